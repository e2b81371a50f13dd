-- Steps: what uses() finds, and rivals.
local acetyl = interconversion "test acetylation" {
    target = "[OX2:1]-[CX3](=O)[CH3]", from = "[OX2H:1].CC(=O)OC(C)=O",
    recipe = "Ac2O, pyridine, cat. DMAP", conditions = "acylation",
    reagents = { "acetic anhydride", "HgSO4" }, cautions = { "pyridine" },
}
local steps = acetyl:back(mol "CC(=O)OCC")
print(#steps, #steps[1].precursors) --> 1	2
local step = steps[1]
print(step:uses "pyridine", step:uses "Acetic", step:uses "hg", step:uses "DMAP", step:uses "mercury") --> true	true	true	true	false
print(step:uses "idine", step:uses(mol "OCC"), step:uses(mol "CO"), step:uses(pattern "C(=O)O")) --> false	true	false	true
print(fails(step.uses, step, 3)) --> uses: a word, a molecule or a pattern is expected, not a number
print(step.equivalents[1], step.equivalents[2], #step.rivals) --> 1	1	0
print(tostring(step):match "%(test acetylation%)$") --> (test acetylation)

-- the other hydroxyl is a rival
steps = acetyl:back(mol "CC(=O)OCC(C)O")
print(#steps[1].rivals > 0) --> true

-- every transform in use
local found = false
for _, s in ipairs(back(mol "CC(=O)OCC")) do found = found or s.transform == "test acetylation" end
print(found) --> true
found = false
for _, set in ipairs(forth(mol "CCO", mol "CC(=O)OC(C)=O")) do
    found = found or set.transform == "test acetylation"
end
print(found) --> true
print(fails(forth)) --> argument 1: molecule or SMILES expected, got nothing

-- How much a step simplifies: two rings of the biaryl become one of each half; the aldol of
-- propanal halves its product and takes two stereocentres away.
synthon "step aryl" { kind = "acceptor", equivalents = { { attach = "Br" } } }
synthon "step boron" { kind = "donor", equivalents = { { attach = "B(O)O" } } }
disconnection "step biaryl" { target = "[c:1]-!@[c:2]", cut = { 1, 2 },
    acceptor = { 1, "step aryl" }, donor = { 2, "step boron" } }
local simpler = transform("step biaryl"):back(mol "c1ccccc1-c1ccccc1")[1]:simplification()
print(simpler.rings, simpler.stereo, simpler.pieces, simpler.halves, simpler.complexity > 0) --> 1	0	2	false	true
interconversion "step aldol" { target = "[CX3;H1:1](=[O:2])[C:3][CX4;H1:4][OX2H:5]",
    from = "[C:1](=[O:2])[C:3].[C:4]=[O:5]" }
simpler = transform("step aldol"):back(mol "O=C[C@@H](C)[C@H](O)CC")[1]:simplification()
print(simpler.rings, simpler.stereo, simpler.pieces, simpler.halves) --> 0	2	1	true
