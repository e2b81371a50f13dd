-- Rewritings: reaction SMARTS applied to molecules. Products are common chemistry.
local reduction = rewrite "[C:1]=[O:2]>>[C:1]-[O:2]"
print(reduction) --> [C:1]=[O:2]>>[C:1]-[O:2]

local outcomes = reduction:apply(mol "CC(C)=O")
print(#outcomes, #outcomes[1], outcomes[1][1] == mol "CC(C)O") --> 1	1	true
print(#reduction:apply(mol "CCO")) --> 0
print(#reduction:apply(mol "O=CCC(C)=O")) --> 2

-- two reactants
local ester = rewrite "[C:1](=[O:2])[OX2H].[OX2H:3][CX4:4]>>[C:1](=[O:2])[O:3][C:4]"
outcomes = ester:apply(mol "CC(=O)O", mol "OCC")
print(#outcomes, outcomes[1][1] == mol "CCOC(C)=O") --> 1	true
print(fails(ester.apply, ester, mol "CC(=O)O"):match "2" ~= nil) --> true
