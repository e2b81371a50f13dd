-- Polarity of bonds and pairs, and of the bond that a step cut. Labels by the rules of Seebach
-- (Angew. Chem. Int. Ed. Engl. 1979, 18, 239; from memory).
local aldol = mol "CC(=O)CC(C)O"
local cut = aldol:polarity(4, 5)
print(cut.labels[1], cut.labels[2], cut.donor, cut.acceptor, #cut.umpolung) --> d2	a1	4	5	0
local turned = aldol:polarity(5, 4)
print(turned.labels[1], turned.labels[2], turned.donor) --> a1	d2	4

local pair = mol("OC(C)C#N"):polarity(1, 5)
print(pair.relation, pair.verdict, #pair.cuts, table.concat(pair.chain, " ")) --> 1,2	dissonant	3	1 2 4 5
print(mol("OC.CN"):polarity(1, 4)) --> nil

local function fails(f, ...)
    local ok, message = pcall(f, ...)
    return not ok and tostring(message):gsub("^.-: ", "", 1)
end
print((fails(aldol.polarity, aldol, 1, 4))) --> atom 1 is no heteroatom
print((fails(aldol.polarity, aldol, 3, 99))) --> atom 99 is not there; the molecule has 7
print((fails(aldol.polarity, aldol, 0, 1))) --> bad argument #2 to '?' (atoms are numbered from 1)

-- A donor cyanide at position 1 is an umpolung; a benzyl end has no heteroatom near.
synthon "polar benzyl" { kind = "acceptor", equivalents = { { attach = "Br" } } }
synthon "polar cyanide" { kind = "donor", equivalents = { { attach = "[Na]", ionic = true } } }
disconnection "polar nitrile" { target = "[c:4]-[CX4;H2:1]-!@[C:2]#[N:3]", cut = { 1, 2 },
    acceptor = { 1, "polar benzyl" }, donor = { 2, "polar cyanide" } }
local step = transform("polar nitrile"):back(mol "N#CCc1ccccc1")[1]
print(table.concat(step.polarity.labels, " "), step.polarity.umpolung[1]) --> alkyl-a d1	d1
print(tostring(step):match "%(.-%)$") --> (polar nitrile; alkyl-a + d1, umpolung)
print(transform("polar nitrile"):back(mol "N#CCc1ccccc1")[1].polarity.acceptor) --> 3
