-- Definitions at the prompt or in a script: synthons, disconnections, interconversions.
synthon "test benzyl" { kind = "acceptor",
    equivalents = { { attach = "Cl" }, { attach = "Br" } } }
synthon "test cyanide" { kind = "donor", equivalents = { { attach = "[Na]", ionic = true } } }

local rule = disconnection "test benzyl cyanide" {
    target = "[c:4]-[CX4;H2:1]-!@[C:2]#[N:3]",
    cut = { 1, 2 },
    acceptor = { 1, "test benzyl" },
    donor = { 2, "test cyanide" },
    conditions = "cyanide",
    recipe = "NaCN, DMSO, 40-60 °C", yield = { 70, 90 },
    cautions = { "sodium cyanide" },
    example { "COc1ccc(CC#N)cc1", from = { "COc1ccc(CCl)cc1", "[Na+].[C-]#N" } },
    refuse { "N#CC(C)(C)c1ccccc1" },
}
print(rule, rule.kind, rule.recipe) --> test benzyl cyanide	disconnection	NaCN, DMSO, 40-60 °C
print(transform "Test-Benzyl Cyanide" == rule, rule.yield[1], rule.yield[2]) --> true	70	90

-- backwards: the two benzyl halides
local steps = rule:back(mol "N#CCc1cccc(F)c1")
print(#steps) --> 2
local seen = {}
for _, step in ipairs(steps) do
    print(step.transform, step.product == mol "N#CCc1cccc(F)c1", #step.precursors) --> test benzyl cyanide	true	2
    for _, m in ipairs(step.precursors) do seen[m:smiles()] = true end
end                                                                               --> test benzyl cyanide	true	2
print(seen[mol("ClCc1cccc(F)c1"):smiles()], seen[mol("BrCc1cccc(F)c1"):smiles()]) --> true	true
print(#rule:back(mol "CCC#N"), #rule:back(mol "CCO")) --> 0	0

-- forwards, reactants in any order
local sets = rule:forth(mol "ClCc1cccc(F)c1", mol "[Na+].[C-]#N")
print(#sets > 0, sets[1].expected, sets[1].transform) --> true	true	test benzyl cyanide
local made = false
for _, m in ipairs(sets[1].products) do made = made or m == mol "N#CCc1cccc(F)c1" end
print(made) --> true
print(#rule:forth(mol "[Na+].[C-]#N", mol "ClCc1cccc(F)c1") > 0) --> true

print((rule:check())) --> true

-- a rule that fails its own test says so
local wrong = interconversion "test wrong" {
    target = "[CX4;H2:1][OX2H:2]", from = "[C:1]=[O:2]",
    example { "CCO", from = { "CCN" } },
    refuse { "CCCO", "CC(C)O" },
}
local ok, failures = wrong:check()
print(ok, #failures) --> false	2
print(failures[1]:match "CCO is not made from .*" ~= nil, failures[2]:match "CCCO is not refused" ~= nil) --> true	true

-- when and prefer
local markovnikov = interconversion "test hydration" {
    target = "[CX4:1]([OX2H:3])[CX4;!H0:2]", from = "[C:1]=[C:2].[O:3]",
    when = function(m) return m.atom[1].carbons >= m.atom[2].carbons end,
    prefer = function(product, m) return m.atom[1].carbons end,
}
print(#markovnikov:back(mol "CC(C)(C)O"), #markovnikov:back(mol "CC(C)CO")) --> 1	0
sets = markovnikov:forth(mol "CC(C)=C", mol "O")
print(sets[1].products[1] == mol "CC(C)(C)O") --> true

local seen_site
interconversion "test site" {
    target = "[CX4:1][OX2H:2]", from = "[C:1]Br.[O:2]",
    when = function(m) seen_site = m; return false end,
}:back "CCO"
print(seen_site.molecule == mol "CCO", seen_site.atom[2].element, seen_site.atom[1].hydrogens, seen_site.atom[3]) --> true	O	2	nil
print(seen_site.atom[2].index, seen_site.atom[2].degree, seen_site.atom[2].charge) --> 3	1	0

local broken = interconversion "test broken" {
    target = "[CX4:1][OX2H:2]", from = "[C:1]Br.[O:2]", when = function(m) return m.atom[9].charge end,
}
print(fails(broken.back, broken, mol "CCO"):match "attempt to index a nil value") --> attempt to index a nil value

-- a definition of one's own may be made anew; a mistake leaves the old one
synthon "test again" { kind = "acceptor", equivalents = { { attach = "Cl" } } }
local function again(target)
    return disconnection "test again" { target = target, cut = { 1, 2 }, acceptor = { 1, "test again" },
        donor = { 2, "test cyanide" } }
end
again "[CX4;H2:1]-!@[C:2]#[N:3]"
print(#transform("test again"):back "CCC#N", #transform("test again"):back "CC(C)C#N") --> 1	0
again "[CX4;H1:1]-!@[C:2]#[N:3]"
print(#transform("test again"):back "CCC#N", #transform("test again"):back "CC(C)C#N") --> 0	1
print((pcall(again, "[C")), #transform("test again"):back "CC(C)C#N") --> false	1
synthon "test again" { kind = "acceptor", equivalents = { { attach = "Cl" }, { attach = "Br" } } }
again "[CX4;H1:1]-!@[C:2]#[N:3]"
print(#transform("test again"):back "CC(C)C#N") --> 2
use "quay"
print(fails(synthon, "quay alkyl", { kind = "acceptor", equivalents = { "Cl" } }):match "there already") --> there already

-- several names
interconversion "test oxidation" { target = "[CX3H1:1]=[O:2]", from = "[C:1]-[OX2H:2]", also = "test Swern" }
print(transform "test-swern") --> test oxidation

-- what is refused
print(fails(transform, "test oxidatoin")) --> no transform named 'test oxidatoin'; did you mean 'test oxidation'?
print(fails(disconnection, "x", { target = "C", cut = { 1, 2 }, acceptr = { 1, "a" } })) --> disconnection "x": unknown field 'acceptr'; did you mean 'acceptor'?
print(fails(disconnection, "x", { target = "[C:1][C:2]", cut = { 1, 2 } })) --> disconnection "x": 'acceptor' is missing (or 'from', to write out the precursors)
print(fails(interconversion, "x", { from = "C" })) --> interconversion "x": 'target' is missing
print(fails(interconversion, "x", { target = "[C:1]", from = "[C:1]", yield = { 90, 70 } })) --> interconversion "x": 'yield' must be a range in per cent such as { 70, 90 }, not this table
print(fails(interconversion, "x", { target = "[C:1]", from = "[C:1]", "stray" })) --> interconversion "x": entry 1 is neither an example nor a refuse
print(fails(synthon, "x", { kind = "acceptor", equivalents = { {} } })) --> synthon "x": equivalent 1: either 'attach' or 'rewrite' is expected
print(fails(example, { "CCO" })) --> example: 'from' is missing; the precursors as SMILES are expected
print(fails(refuse, {})) --> refuse: a product as SMILES is expected
print(fails(disconnection, 5)) --> disconnection: a name is expected, not a number
