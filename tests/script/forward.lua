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

-- Syn and anti addition (Clayden, Greeves, Warren, Organic Chemistry; from memory): E gives the meso dibromide, Z the
-- racemic one; a ring of six gives the trans dibromide; the epoxide keeps the geometry, forwards and backwards
local function adding(way, target, from)
    return interconversion("t addition " .. way) { target = target, from = from, addition = { way, 1, 2 } }
end
local anti = adding("anti", "[C:1]([Br:3])[C:2][Br:4]", "[C:1]=[C:2]")
local syn = adding("syn", "[C:1]1[O:3][C:2]1", "[C:1]=[C:2]")
print(anti:forth(mol "C/C=C/C")[1].products[1] == mol "C[C@@H](Br)[C@@H](Br)C") --> true
print(anti:forth(mol "C/C=C\\C")[1].products[1] == mol "C[C@@H](Br)[C@@H](Br)C") --> false
print(#anti:back(mol "Br[C@@H]1CCCC[C@H]1Br"), #anti:back(mol "Br[C@H]1CCCC[C@H]1Br")) --> 1	0
print(anti:back(mol "C[C@@H](Br)[C@@H](Br)C")[1].precursors[1]) --> C/C=C/C
print(syn:back(mol "C[C@@H]1O[C@@H]1C")[1].precursors[1]) --> C/C=C\C
print(syn:forth(mol "C/C=C\\C")[1].products[1] == mol "C[C@@H]1O[C@@H]1C") --> true
print(fails(adding, "over", "[C:1][C:2]", "[C:1]=[C:2]")) --> interconversion "t addition over": 'addition' must be { "syn", map, map } or { "anti", map, map }
print(fails(adding, "syn", "[C:1][O:3][C:2]", "[C:1]=[C:2]")) --> t addition syn: addition: expected two maps with a bond on both sides

-- E2 in a ring wants hydrogen and halogen anti: menthyl chloride (the same source)
local e2 = interconversion "t e2" { target = "[C:1]=[C:2]", from = "[C:1](Cl)[C;!H0:2]", addition = { "anti", 1, 2 } }
print(#e2:forth(mol "C[C@@H]1CC[C@H]([C@@H](C1)Cl)C(C)C"), #e2:forth(mol "CC1CCC(C(C1)Cl)C(C)C")) --> 1	2

-- Where electrophiles go (Clayden, Greeves, Warren; Joule, Mills, Heterocyclic Chemistry; from memory)
local function first(smiles)
    local m, best, at = mol(smiles), -1000, 0
    for i, atom in ipairs(m:atoms()) do
        if atom.aromatic and atom.element == "C" and atom.hydrogens > 0 and m:rate(i, "electrophile") > best + 1e-6 then
            best, at = m:rate(i, "electrophile"), i
        end
    end
    return at
end
print(first "c1ccc2ccccc2c1", first "c1ccc2[nH]ccc2c1", first "c1ccncc1", first "[O-][n+]1ccccc1") --> 3	7	2	5
print(first "c1ccoc1", first "c1ccsc1", first "O=[N+]([O-])c1ccccc1", first "c1ccc2cnccc2c1") --> 3	3	6	10
print(fails(mol("CC").rate, mol "CC", 1, "electrophile")) --> atom 1 is no aromatic carbon
print(fails(mol("CC").stability, mol "CC", 3, "cation")) --> the molecule has no atom 3
print(#mol("CCO"):neighbours(2), mol("CCO"):neighbours(2)[2].element) --> 2	O
