-- Why a transform makes nothing of a molecule: 25 near misses made by hand, each with the reason that
-- a chemist would give (common practice, no source).
synthon "why alkyl" { kind = "acceptor", equivalents = { { attach = "Br" } } }
synthon "why alkoxide" { kind = "donor", equivalents = { { attach = "[H]" } } }
synthon "why boron" { kind = "donor", equivalents = { { attach = "B(O)O" } } }
disconnection "why ether" { target = "[CX4;H2,H3:1]-!@[OX2:2]-[#6X4,c:3]", cut = { 1, 2 },
    acceptor = { 1, "why alkyl" }, donor = { 2, "why alkoxide" } }
disconnection "why biaryl" { target = "[c:1]-!@[c:2]", cut = { 1, 2 },
    acceptor = { 1, "why alkyl" }, donor = { 2, "why boron" } }
interconversion "why hydration" { target = "[CX4;H0,H1:1]([OX2H:3])[CX4;!H0:2]",
    from = "[C:1]=[C:2]" }
interconversion "why ester" { target = "[CX3:1](=[O:2])[OX2H0:3][CX4:4]",
    from = "([C:1](=[O:2])O.[OH:3][C:4])" }
interconversion "why z alkene" { target = "[C:1]/[CX3;H1:2]=[CX3;H1:3]\\[C:4]",
    from = "[C:1][C:2]#[C:3][C:4]" }
interconversion "why alkene" { target = "[CX4:1][CX4;!H0:2]", from = "[C:1]=[C:2]" }
interconversion "why benzoin" { target = "[c:1][C:2](=[O:3])[CX4;H1:4]([OX2H:5])[c:6]",
    from = "[c:1][C:2]=[O:3].[c:6][C:4]=[O:5]",
    when = function(m) return m.atom[1].symmetry == m.atom[6].symmetry end }
interconversion "why nothing" { target = "[CX4:1][Br:2]", from = "[C:1]Br" }
interconversion "why chain" { target = "[CX4:1]-[#6]", from = "[C:1]Br" }
interconversion "why amine" { target = "[NX3;H2:1]-[CX4;H2:2][#6:3]", from = "[N:1]#[C:2][#6:3]" }

local function why(name, smiles)
    local found = transform(name):why(mol(smiles))
    local first = found[1]
    print(found.steps, first and first.kind, first and first.text)
end

-- Ethers by substitution: the halide must be primary or methyl, the bond single and open.
why("why ether", "CC(C)(C)OC(C)(C)C") --> 0	pattern	atom 2 (C) does not fit [H2,H3]: it has 0 hydrogens
why("why ether", "CC(C)OC(C)C") --> 0	pattern	atom 2 (C) does not fit [H2,H3]: it has 1 hydrogen
why("why ether", "CCSCC") --> 0	pattern	atom 3 (S) does not fit O
why("why ether", "CCO") --> 0	pattern	atom 3 (O) has no neighbour left for [#6&X4,c:3]
why("why ether", "C1CCOC1") --> 0	pattern	atoms 3 and 4 are joined by the wrong kind of bond: in a ring, single
why("why ether", "CCOC(C)=O") --> 0	pattern	atom 4 (C) does not fit [#6&X4,c]
why("why ether", "CC(=O)OC(C)(C)C") --> 0	pattern	atom 2 (C) does not fit [X4]: it has 3 connections; atom 2 (C) does not fit [H2,H3]: it has 0 hydrogens

-- Biaryls: both ends aromatic, and the bond in no ring.
why("why biaryl", "C1CCCCC1c1ccccc1") --> 0	pattern	atom 6 (C) does not fit c
why("why biaryl", "c1ccccc1") --> 0	pattern	atoms 1 and 2 are joined by the wrong kind of bond: in a ring, aromatic

-- Hydration by Markovnikov's rule gives no primary alcohol; the neighbour needs a hydrogen.
why("why hydration", "CCCO") --> 0	pattern	atom 3 (C) does not fit [H0,H1]: it has 2 hydrogens
why("why hydration", "OC(c1ccccc1)c1ccccc1") --> 0	pattern	atom 3 (aromatic C) does not fit C; atom 3 (aromatic C) does not fit [X4]: it has 3 connections; atom 3 (aromatic C) does not fit [!H0]: it has 0 hydrogens
why("why hydration", "COC(C)C") --> 0	pattern	atom 2 (O) does not fit [H1]: it has 0 hydrogens
why("why hydration", "OC(C(F)(F)F)C(F)(F)F") --> 0	pattern	atom 3 (C) does not fit [!H0]: it has 0 hydrogens

-- Esters, amines.
why("why ester", "CC(=O)NC") --> 0	pattern	atom 4 (N) does not fit O; atom 4 (N) does not fit [X2]: it has 3 connections; atom 4 (N) does not fit [H0]: it has 1 hydrogen
why("why ester", "CC(=O)O") --> 0	pattern	atom 4 (O) does not fit [H0]: it has 1 hydrogen; atom 4 (O) has no neighbour left for [C&X4:4]
why("why ester", "CC(=O)Oc1ccccc1") --> 0	pattern	atom 5 (aromatic C) does not fit C; atom 5 (aromatic C) does not fit [X4]: it has 3 connections
why("why amine", "CNCC") --> 0	pattern	atom 2 (N) does not fit [H2]: it has 1 hydrogen
why("why amine", "NC(C)C") --> 0	pattern	atom 2 (C) does not fit [H2]: it has 1 hydrogen

-- A Z alkene is asked for.
why("why z alkene", "CC/C=C/CC") --> 0	pattern	atoms and bonds of the target fit, but not the geometry of its double bond
why("why z alkene", "CCC=CCC") --> 0	pattern	atoms and bonds of the target fit, but not the geometry of its double bond

-- The pattern fits, but: the precursor cannot be, the condition refuses, nothing changes.
why("why alkene", "C1C2CC3CC1CC(C2)C3") --> 0	strain	a precursor would have a multiple bond that its ring cannot hold
why("why benzoin", "OC(C(=O)c1ccccc1)c1ccc(C)cc1") --> 0	when	the target fits, but the rule's `when` refuses it
why("why nothing", "CCBr") --> 0	same	the product is among its own precursors

-- What the rule takes away it does not put on again: forwards it gives another chain.
why("why chain", "BrCc1ccccc1") --> 0	forward	BrCBr would give CCBr instead
why("why amine", "NCCO") --> 1	nil	nil
why("why amine", "NCC(F)(F)F") --> 1	nil	nil
why("why amine", "NCCN") --> 1	nil	nil

local marked = transform("why hydration"):why(mol "CCCO")[1]
print(marked.marked, table.concat(marked.atoms, " ")) --> CC[CH2:1]O	3
print(transform("why hydration"):why(mol "CC(C)O"))
--> why hydration: 1 step
print(transform("why ether"):why(mol "CCSCC"))
--> why ether: 0 steps
-->   atom 3 (S) does not fit O  CC[S:1]CC

-- What can be done to a target at all, and what nearly.
interconversion "why large" { target = "[NX3;H2:1]-[CX4;H2:2]-c1ccc(F)cc1",
    from = "[N:1]#[C:2]-c1ccc(F)cc1" }
local found = {}
for _, idea in ipairs(mol("CC(O)c1ccc(F)cc1"):ideas()) do found[idea.transform] = idea end
print(found["why hydration"].fires) --> true
print(found["why hydration"].text == "from " .. tostring(mol "C=Cc1ccc(F)cc1")) --> true
for _, idea in ipairs(mol("NC(C)c1ccc(F)cc1"):ideas()) do found[idea.transform] = idea end
print(found["why large"].fires, found["why large"].text)
--> false	atom 2 (C) does not fit [H2]: it has 1 hydrogen
print(select(2, pcall(transform("why ether").why, transform("why ether"), 7)).message)
--> why: argument 2: molecule or SMILES expected, got number

-- A ring of the wrong kind, a charge, a missing group.
interconversion "why acylation" { target = "[c;r6:1][CX3:2](=[O:3])[CX4:4]",
    from = "[cH:1].[C:2](=[O:3])([C:4])Cl" }
interconversion "why salt" { target = "[CX4:1][NX4;+1:2]", from = "[C:1]Br.[N;+0:2]" }
why("why acylation", "CC(=O)c1ccco1") --> 0	pattern	atom 4 (aromatic C) does not fit [r6]: its smallest ring has 5 members
why("why acylation", "O=Cc1ccccc1") --> 0	pattern	atom 2 (C) has no neighbour left for [C&X4:4]
why("why salt", "CN(C)C") --> 0	pattern	atom 2 (N) does not fit [X4]: it has 3 connections; atom 2 (N) does not fit [+]: its charge is 0
