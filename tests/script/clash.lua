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
