-- Groups, what classes of conditions do to them, and correcting that in one line. What is expected of molecules is
-- common practice, no source, unless said otherwise.

local function groups(smiles)
    local names = {}
    for i, hit in ipairs(mol(smiles):groups()) do
        names[i] = hit.group .. " " .. table.concat(hit.atoms, ",")
    end
    return table.concat(names, "; ")
end

-- Narrower groups hide wider ones: a tert-butyl ester is no plain ester, an enone neither a ketone nor an alkene.
local function has(smiles, group)
    return string.find("; " .. groups(smiles), "; " .. group .. " ", 1, true) ~= nil
end
print(has("CC(=O)OC(C)(C)C", "tert-butyl-ester"), has("CC(=O)OC(C)(C)C", "ester"))   --> true	false
print(has("CC(=O)C=C", "enone"), has("CC(=O)C=C", "ketone"), has("CC(=O)C=C", "alkene"))  --> true	false	false
print(groups "CC")                                    -->
print(groups "OCCN")                                  --> primary-amine 4; primary-alcohol 1,2; beta-amino-alcohol 1,2,3,4

local function clashes(smiles, class, reacting)
    local list, cautions = mol(smiles):clashes(class, { reacting = reacting })
    local names = {}
    for i, clash in ipairs(list) do names[i] = clash.group end
    for _, caution in ipairs(cautions) do names[#names + 1] = "(" .. caution.group .. ")" end
    return #names > 0 and table.concat(names, " ") or "nothing"
end

local keto_ester = "CC(=O)CCC(=O)OC"
print(clashes(keto_ester, "nabh4", { 2, 3 }))         --> nothing
print(clashes(keto_ester, "lialh4", { 2, 3 }))        --> methyl-ester
print(clashes(keto_ester, "LiAlH4", { 2, 3 }))        --> methyl-ester
print(clashes("CCCC", "lialh4"))                      --> nothing
print(#mol("CCO"):clashes "grignard")                 --> 1

-- A verdict corrected: on the wider group it does not touch a narrower one that has its own; the last one stands.
verdict { group = "methyl-ester", conditions = "nabh4", "attacked", why = "large excess at reflux" }
print(clashes(keto_ester, "nabh4", { 2, 3 }))         --> methyl-ester
print(mol(keto_ester):clashes("nabh4", { reacting = { 2, 3 } })[1].why)  --> large excess at reflux
verdict { group = { "methyl-ester", "ethyl-ester" }, conditions = { "nabh4", "borane" }, "survives" }
print(clashes(keto_ester, "nabh4", { 2, 3 }))         --> nothing
print(clashes("CC(=O)CCC(=O)OCC", "borane", { 2, 3 })) --> nothing

-- Groups and classes of one's own. A group without verdicts has the worst of its parents'.
group "our peroxy ester" { smarts = "[CX3](=O)OO[#6]", examples = { "CC(=O)OOC" }, also = "perester" }
group "our tert-butyl perester" { smarts = "[CX3](=O)OOC([CH3])([CH3])[CH3]", parents = "perester" }
conditions "our copper" {
    attacks = { { "perester", why = "Kharasch-Sosnovsky" } }, slow = { "alkene" },
}
print(clashes("CC(=O)OOC(C)(C)C", "our copper"))      --> our tert-butyl perester
verdict { group = "our tert-butyl perester", conditions = "our copper", "slow" }
print(clashes("CC(=O)OOC(C)(C)C", "our copper"))      --> (our tert-butyl perester)
print(clashes("CC(=O)OOC", "our copper"))             --> our peroxy ester

-- What a script has defined, it may define anew.
conditions "our copper" { survives = { "perester" } }
print(clashes("CC(=O)OOC", "our copper"))             --> nothing
group "our peroxy ester" { smarts = "[CX3](=O)OO[CH3]", also = "perester" }
print(groups "CC(=O)OOCC")                            --> peroxide 4,5

-- Mistakes.
print(fails(function() return mol("CCO"):clashes "nabh" end))
--> no class of conditions 'nabh'; did you mean 'nabh4'?
print(fails(function() return mol("CCO"):clashes("nabh4", { reacting = { 4 } }) end))
--> clashes: 'reacting': entry 1 is no atom; numbers from 1 to 3 are expected
print(fails(function() return mol("CCO"):clashes("nabh4", { reacting = 4 }) end))
--> clashes: 'reacting' must be a list of atoms, not a number
print(fails(function() return mol("CCO"):clashes("nabh4", { atoms = {} }) end))
--> clashes: unknown field 'atoms'
print(fails(function() return mol("CCO"):clashes() end))
--> clashes: a class of conditions is expected, not a nil
print(fails(function() group "x" { smarts = "[CX9" } end))
--> group "x": smarts: '[' is never closed, expected ']'
print(fails(function() group "x" {} end))             --> group "x": 'smarts' is missing
print(fails(function() group "x" { smarts = "C", parents = { "nothing" } } end))
--> group "x": parents: there is no group "nothing"
print(fails(function() group "ketone" { smarts = "C" } end))
--> group "ketone": there is a group "ketone" already
print(fails(function() group "x" { smarts = "C", also = { "keto acid", "Ketone" } } end))
--> group "x": there is a group "Ketone" already
print(fails(function() group "x" { smarts = "C", examples = { { "CC" } } } end))
--> group "x": example 1: SMILES or { SMILES, hits } is expected
print(fails(function() group "x" { smart = "C" } end))
--> group "x": unknown field 'smart'; did you mean 'smarts'?
print(fails(function() conditions "x" { attacks = { "nothing" } } end))
--> conditions "x": attacked: there is no group "nothing"
print(fails(function() conditions "x" { attacks = { ketone = true } } end))
--> conditions "x": attacks: unknown field 'ketone'; a list is expected
print(fails(function() conditions "nabh4" {} end))
--> conditions "nabh4": there is a class of conditions "nabh4" already
print(fails(function() verdict { group = "ketone", conditions = "nabh4", "dead" } end))
--> verdict: "attacked", "slow" or "survives" is expected, beside group and conditions
print(fails(function() verdict { group = "keton", conditions = "nabh4", "slow" } end))
--> verdict on "keton": group: there is no group "keton"
print(fails(function() verdict { group = "ketone", conditions = "nabh", "slow" } end))
--> verdict on "ketone": conditions: there is no class of conditions "nabh"
print(fails(function() verdict { group = "ketone", "slow" } end))  --> verdict: 'conditions' is missing
print(fails(function()
    protecting "x" { guards = "alcohol", installed_by = "silylation", removed_by = "fluoride", like = "ether" }
end))
--> protecting "x": 'example' is missing
print(fails(function()
    protecting "x" { guards = "alcohol", installed_by = "silylation", removed_by = "fluoride", group = "tbs-ether",
        example = "CCO" }
end))
--> protecting "x": example: the molecule shows no group "tbs-ether"
print(fails(function() incompatible "x" { "ketone" } end))
--> incompatible "x": two groups, or two lists of groups, are expected
print(fails(function() incompatible "x" { "ketone", "keton" } end))
--> incompatible "x": the second list: there is no group "keton"

-- ---- Steps ------------------------------------------------------------------------------------

-- The step of a transform with this precursor, and what clashes in it.
local function step_of(name, product, precursor)
    for _, step in ipairs(transform(name):back(mol(product))) do
        for i, m in ipairs(step.precursors) do
            if m == mol(precursor) then return step, i end
        end
    end
end

local function names(list)
    local texts = {}
    for i, clash in ipairs(list) do
        texts[i] = clash.group .. (clash.other and " with " .. clash.other or "")
    end
    return #texts > 0 and table.concat(texts, ", ") or "nothing"
end

interconversion "our ketone reduction" {
    target = "[CX4;H1:1]([OX2H:2])([#6:3])[#6:4]", from = "[CX3:1](=[O:2])([#6:3])[#6:4]",
    conditions = "lialh4",
}
local step, where = step_of("our ketone reduction", "CC(O)CCC(=O)OC", "CC(=O)CCC(=O)OC")
print(names(step.clashes), step.clashes[1].precursor == where)  --> methyl-ester	true
print(#step.clashes[1].atoms, #step.reacting[where])  --> 4	2
print(names(step_of("our ketone reduction", "CC(O)CCC(C)=O", "CC(=O)CCC(C)=O").clashes))  --> alkyl-ketone
print(names(step_of("our ketone reduction", "CC(O)CCC(C)C", "CC(=O)CCC(C)C").clashes))    --> nothing

-- A recipe differs from its class in both directions; the nearer word counts.
interconversion "our mild reduction" {
    target = "[CX4;H1:1]([OX2H:2])([#6:3])[#6:4]", from = "[CX3:1](=[O:2])([#6:3])[#6:4]",
    conditions = "lialh4", spares = { "ester" }, also_attacks = { "other nitrile", "acetate ester" },
}
print(names(step_of("our mild reduction", "CC(O)CCC(=O)OC", "CC(=O)CCC(=O)OC").clashes))   --> nothing
print(names(step_of("our mild reduction", "CC(O)CCOC(C)=O", "CC(=O)CCOC(C)=O").clashes))   --> acetate-ester
print(names(step_of("our mild reduction", "CC(O)CCC#N", "CC(=O)CCC#N").clashes))           --> nitrile

-- `slow` is a worry.
verdict { group = "methyl-ester", conditions = "lialh4", "slow" }
step = step_of("our ketone reduction", "CC(O)CCC(=O)OC", "CC(=O)CCC(=O)OC")
print(names(step.clashes), names(step.worries))       --> nothing	methyl-ester
verdict { group = "methyl-ester", conditions = "lialh4", "attacked" }

-- Reactions inside one precursor, and a closure that is wanted. Common practice, no source.
interconversion "our N-debenzylation" {
    target = "[NX3;H2:1][CX4:2]", from = "[N:1]([C:2])Cc1ccccc1", conditions = "h2-pd",
}
local function inside(product, precursor)
    return names(step_of("our N-debenzylation", product, precursor).clashes)
end
print(inside("NCCCBr", "BrCCCNCc1ccccc1"))            --> secondary-amine with primary-alkyl-halide
print(inside("NCCC=O", "O=CCCNCc1ccccc1"))            --> secondary-amine with aldehyde
print(inside("NCCC(=O)Cl", "ClC(=O)CCNCc1ccccc1"))    --> acyl-halide, acyl-halide with secondary-amine
interconversion "our ring closure" {
    target = "[NX3:1]1[CX4:2][C:3][C:4][C:5]1", from = "[N:1][C:5][C:4][C:3][C:2]Br", conditions = "amine-heat",
}
print(names(step_of("our ring closure", "C1CCNC1", "NCCCCBr").clashes))  --> nothing
interconversion "our Grignard addition" {
    target = "[CX4:1]([OX2H:2])[CH3:3]", from = "[CX3:1]=[O:2].[CH3:3][Mg]Br", conditions = "grignard",
}
print(names(step_of("our Grignard addition", "CC(C)(O)CCCO", "CC(=O)CCCO").clashes))      --> primary-alcohol

-- A dimer whose halves react at different atoms: no half is its own bystander.
interconversion "our aldol" {
    target = "[CX4;H1:1]([OX2H:2])[CH2:3][CH1:4]=[O:5]", from = "[C:1]=[O:2].[C:3][C:4]=[O:5]",
    conditions = "base-aq-mild",
}
print(names(step_of("our aldol", "CC(O)CC=O", "CC=O").clashes))  --> nothing

-- ---- Protection -------------------------------------------------------------------------------

local function proposed(step)
    local found = {}
    for _, one in ipairs(step:protections()) do found[one.name] = one end
    return found
end

-- A hydroxyl beside a Grignard reagent is silylated; an ester of it would not stand the reagent (Greene and Wuts, from
-- memory).
local found = proposed(step_of("our Grignard addition", "CC(C)(O)CCCO", "CC(=O)CCCO"))
print(found.tbs.group, found.tbs.verdict, found.tbs.installed_by, found.tbs.removed_by)
--> primary-alcohol	survives	silylation	fluoride
print(found.acetate, found.boc)                       --> nil	nil
-- A second ketone beside a hydride is kept as the acetal, never as an ester.
found = proposed(step_of("our ketone reduction", "CC(O)CCC(C)=O", "CC(=O)CCC(C)=O"))
print(found.methyl_ester, found.tbs)                  --> nil	nil
-- An ester is no group that protecting groups guard.
print(#step_of("our ketone reduction", "CC(O)CCC(=O)OC", "CC(=O)CCC(=O)OC"):protections())  --> 0

-- One's own protecting group.
protecting "our shield" { guards = "primary-alcohol", like = "tips-ether", example = "CO[Si](C)(C)C",
    installed_by = "silylation", removed_by = { "acid-aq-mild", "fluoride" }, slow = "grignard" }
found = proposed(step_of("our Grignard addition", "CC(C)(O)CCCO", "CC(=O)CCCO"))
print(found["our shield"].verdict)                    --> slow

-- ---- Plans ------------------------------------------------------------------------------------

-- A reduction that meets an ester.
local function cheapest(policy, cost)
    local routes = plan { target = "CC(O)CCC(=O)OC", catalogue = { "CC(=O)CCC(=O)OC" }, quiet = true,
        transforms = { "our ketone reduction" }, limits = { depth = 1 }, clashes = policy, clash_cost = cost }
    return #routes, routes[1] and string.format("%.1f", routes[1].cost)
end
print(cheapest())                                     --> 1	177.6
print(cheapest("penalise", 10))                       --> 1	71.8
print(cheapest("allow"))                              --> 1	60.0
print(cheapest("refuse"))                             --> 0	nil
print(fails(cheapest, "forbid"))
--> plan: 'clashes' must be "penalise", "allow" or "refuse", not 'forbid'
print(fails(cheapest, "penalise", -1))                --> plan: 'clash_cost' must be a number of 0 or more, not -1
local route = plan { target = "CC(O)CCC(=O)OC", catalogue = { "CC(=O)CCC(=O)OC" }, quiet = true,
    transforms = { "our ketone reduction" } }[1]
print(tostring(route):find("(clash: methyl-ester)", 1, true) ~= nil)  --> true
local step_of_route = route:steps()[1]
print(names(step_of_route.clashes), names(step_of_route.worries), #step_of_route:protections())
--> methyl-ester	nothing	0

-- The esters of a malonate belong to its reacting CH, the ketones of a 1,3-diketone likewise.
interconversion "our malonate alkylation" {
    target = "[CH1;$(C(C=O)C=O):1]-[CH2:2][#6:3]", from = "[C:1].[C:2]([#6:3])Br", conditions = "alkoxide",
}
print(names(step_of("our malonate alkylation", "COC(=O)C(CC)C(=O)OC", "COC(=O)CC(=O)OC").clashes))  --> nothing
print(names(step_of("our malonate alkylation", "CC(=O)C(CC)C(C)=O", "CC(=O)CC(C)=O").clashes))      --> nothing
print(names(step_of("our malonate alkylation", "COC(=O)C(CCOC(C)=O)C(=O)OC", "BrCCOC(C)=O").clashes))  --> acetate-ester
