-- Which product is the major one: shared preferences, kinds of rivals, minor steps, reagents that need not be given.
preference "t markovnikov" {
    roles = { "carbon" },
    score = function(product, m) return m.atom.carbon.carbons end,
}
local hydration = interconversion "t hydration" {
    target = "[CX4:1]([OX2H:3])[CX4;!H0:2]", from = "[C:1]=[C:2].[O:3]",
    prefer = { "t markovnikov", carbon = 1 },
    example { "CC(C)CO", from = { "CC(C)=C", "O" } },
}

-- Markovnikov (common practice, no source); water is written out in full and need not be given
local sets = hydration:forth(mol "CC(C)=C")
print(#sets, sets[1].products[1], sets[1].expected, sets[1].major, sets[1].kind) --> 2	CC(C)(C)O	true	true	nil
print(sets[2].products[1], sets[2].expected, sets[2].major, sets[2].kind) --> CC(C)CO	false	false	regio
print(#hydration:forth(mol "CC(C)=C", mol "O"), #hydration:forth(mol "CC(C)=C", mol "C")) --> 2	0

-- a minor product is no step, unless one asks
print(#hydration:back(mol "CC(C)CO"), #hydration:back(mol "CC(C)CO", { minor = false })) --> 0	0
local step = hydration:back(mol "CC(C)CO", { minor = true })[1]
print(step.minor, step.rivals[1][1], step.rivals[1].kind) --> true	CC(C)(C)O	regio
print(hydration:back(mol "CC(C)(C)O")[1].minor) --> false
print(select(2, hydration:check())[1]:match "t hydration: .*") --> t hydration: CC(C)CO is not the major product from C=C(C)C + O, but CC(C)(C)O
print(fails(hydration.back, hydration, mol "CCO", { major = true })) --> back: the only option is 'minor'
print(fails(hydration.back, hydration, mol "CCO", { minor = 1 })) --> back: 'minor' must be true or false, not a number

-- kinds: another group reacts, the product reacts again, the stereo differs
local acetylation = interconversion "t acetylation" {
    target = "[OX2:1]-[CX3](=O)[CH3]", from = "[OX2H:1].CC(=O)OC(C)=O",
}
local kinds = {}
for _, set in ipairs(acetylation:forth(mol "OCCC(C)O")) do
    kinds[#kinds + 1] = set.kind or "expected"
end
print(table.concat(kinds, " ")) --> expected expected over-reaction
local methylation = interconversion "t methylation" {
    target = "[CX4;!H0:3][NX3:1][CH3:2]", from = "[C:3][NX3;!H0:1].[CH3:2]I",
}
local rivals = methylation:back(mol "CNCC")[1].rivals
print(#rivals, rivals[1][1], rivals[1].kind) --> 1	CN(C)CC	over-reaction
local bromination = interconversion "t addition of bromine" {
    target = "Br[C@@H:1]([#6:3])[C@@H:2]([#6:4])Br", from = "[CH:1]([#6:3])=[CH:2][#6:4]",
}
print(#bromination:forth(mol "C1CCC=CC1") > 0) --> true
local silylation = interconversion "t silylation" {
    target = "[CX4;H2:3][OX2:1][Si:2](C)(C)C", from = "[C:3][OX2H:1].[Si:2](C)(C)(C)Cl",
}
rivals = silylation:back(mol "CC(O)CCO[Si](C)(C)C")[1].rivals
print(#rivals, rivals[1][1], rivals[1].kind) --> 1	C[Si](C)(C)OC(C)CCO	chemo

-- mistakes in a definition
local function prefer(p)
    return interconversion("t mistake", { target = "[CX4:1][OX2H:2]", from = "[C:1]=[O:2]", prefer = p })
end
print(fails(prefer, "t nobody")) --> t mistake: prefer: there is no preference "t nobody"
print(fails(prefer, "t markovnikov")) --> t mistake: prefer: "t markovnikov" needs a map number for 'carbon'
print(fails(prefer, { "t markovnikov", carbon = 9 })) --> t mistake: prefer: map number 9 is not in the target
print(fails(prefer, { "t markovnikov", carbon = 1, wood = 2 })) --> t mistake: prefer: "t markovnikov" knows no 'wood'
print(fails(prefer, { "t markovnikov", carbon = "1" })) --> interconversion "t mistake": prefer: 'carbon' must be a map number
print(fails(prefer, 1)) --> interconversion "t mistake": 'prefer' must be a function or name a preference, not a number
print(fails(preference, "t empty", {})) --> preference "t empty": 'score' is missing, a function
