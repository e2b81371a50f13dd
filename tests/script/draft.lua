-- Drafts of transforms from one reaction. What must come out is read off the reactions, which are common
-- practice, no source: which atoms a rule must name, and what else it must then make.
local function loaded(reaction, options)
    local text, works = draft(reaction, options)
    return assert(load("return " .. text))(), works, text
end
local function makes(rule, product)
    local list = {}
    for _, step in ipairs(rule:back(mol(product))) do
        local names = {}
        for i, m in ipairs(step.precursors) do names[i] = m:smiles() end
        list[#list + 1] = table.concat(names, " + ")
    end
    return #list > 0 and table.concat(list, "; ") or "nothing"
end
local function same(a, b) return mol(a):smiles() .. " + " .. mol(b):smiles() end

-- Acylation of an amine: the draft serves other amines and other acyl chlorides.
local amide, works, text = loaded("NCCc1ccccc1.CC(=O)Cl>CCN(CC)CC.ClCCl>CC(=O)NCCc1ccccc1", { name = "acylation" })
print(works, (amide:check()), amide.kind, amide.name) --> true	true	disconnection	acylation
print(#amide.reagents, mol(amide.reagents[1]) == mol "CCN(CC)CC") --> 2	true
local made = makes(amide, "CCC(=O)NCC1CCCCC1")
print(made == same("NCC1CCCCC1", "CCC(=O)Cl") or made == same("CCC(=O)Cl", "NCC1CCCCC1")) --> true
print(makes(amide, "COC(=O)C"), makes(amide, "CC(=O)N(C)C")) --> nothing	nothing

-- Reduction of a ketone; an interconversion.
local reduction = loaded "O=C1CCCCC1>>OC1CCCCC1"
print(reduction.kind, makes(reduction, "CCC(O)CC")) --> interconversion	CCC(=O)CC
print(makes(reduction, "CC(C)(O)C")) --> nothing

-- Mapped by atom classes: saponification with labelled oxygen, where the least change alone would keep the
-- alkoxy oxygen in the acid. The classes say that the acyl bond breaks, as it does (Polanyi and Szabo 1934, from memory).
local acyl, _, mapped = loaded "[CH3:1][C:2](=[O:3])OCC.[OH2:4]>>[CH3:1][C:2](=[O:3])[OH:4]"
print(mapped:find("O[CH2]C", 1, true) ~= nil or mapped:find("OCC", 1, true) ~= nil) --> true
print((acyl:check()), makes(acyl, "CCC(=O)O")) --> true	CCC(=O)OCC + O
-- Mapped in part: the rest is found.
local alkyl = loaded "[CH3:1]I.c1ccccc1O>>[CH3:1]Oc1ccccc1"
print((alkyl:check())) --> true

-- Inversion: the draft makes the other hand of the alcohol.
local inverted = loaded "C[C@H](O)CCc1ccccc1>>C[C@@H](Br)CCc1ccccc1"
print((inverted:check()), #inverted:back(mol "CC[C@@H](Br)C")) --> true	1
local hand = inverted:back(mol "CC[C@@H](Br)C")[1].precursors[1]
print(hand == mol "CC[C@H](O)C" or hand == mol "CC[C@@H](O)C") --> true

-- Which carbon-oxygen bond of two breaks: the acyl one (Fischer), not the alkyl one; the alkyl one (Mitsunobu), not
-- the aryl one. Textbook mechanisms, from memory.
local fischer = loaded "CC(=O)O.OCC>[H+]>CC(=O)OCC"
print(makes(fischer, "CC(=O)OC(C)(C)C") ~= "nothing", fischer.target:find("=[O", 1, true) ~= nil) --> true	true
local ether = loaded "Oc1ccccc1.OCC>>CCOc1ccccc1"
print(makes(ether, "CCCOc1ccncc1") ~= "nothing", makes(ether, "c1ccccc1Oc1ccccc1")) --> true	nothing

-- A centre that only turns (Mitsunobu), and a cis reduction of an alkyne: the rule makes no trans alkene.
local turned = loaded "C[C@H](O)CCc1ccccc1>>C[C@@H](O)CCc1ccccc1"
print(turned:back(mol "CC[C@@H](O)C")[1].precursors[1] == mol "CC[C@H](O)C") --> true
local cis = loaded "CCC#CC>>CC/C=C\\C"
print(makes(cis, "CCC/C=C\\CC") == mol("CCCC#CCC"):smiles(), makes(cis, "CCC/C=C/CC")) --> true	nothing

-- A salt as reactant, the by-products and what comes from nowhere.
local _, salt = loaded "COc1ccc(CCl)cc1.[Na+].[C-]#N>>COc1ccc(CC#N)cc1.[Na+].[Cl-]"
local _, acid = loaded "CCO>>CC(=O)O"
print(salt, acid) --> true	true
print((draft("CCO.CC(=O)Cl>>CC(=O)OCC.Cl"):match "left out[^\n]*")) --> left out of the products: Cl
print((draft("Oc1ccccc1>>COc1ccccc1"):match "%d carbon[^\n]*")) --> 1 carbon atom of the product is in none of the reactants

-- The radius, and one result each time.
local wide = draft("O=C1CCCCC1>>OC1CCCCC1", { radius = 3 })
print(#wide > #draft("O=C1CCCCC1>>OC1CCCCC1", { radius = 0 })) --> true
print(wide == draft("O=C1CCCCC1>>OC1CCCCC1", { radius = 3 })) --> true

print(fails(draft, "CCO")) --> expected a reaction, "reactants>>product", with two '>'
print(fails(draft, "CCO>>")) --> expected the product behind '>'
print(fails(draft, ">>CCO")) --> expected the reactants before '>'
print(fails(draft, "CCO>>CC=O>>C")) --> a third '>' in the reaction
print(fails(draft, "CCO>>CC=O C")) --> a blank in the reaction
print(fails(draft, "[CH3:1]O>>[NH2:1]C")) --> atom class 1 is C in the reactants and N in the product
print(fails(draft, "[CH3:1][OH:1]>>CO")) --> atom class 1 stands twice in the reactants
print(select(2, pcall(draft, "CCO>>CC(C")).position) --> 8
print(select(2, pcall(draft, "C%>>C")).position ~= nil) --> true
print(fails(draft, "C>>C", { radios = 1 })) --> draft: there is no option "radios"; radius and name are
print(fails(draft, "C>>C", { radius = 1.5 })) --> draft: radius is a whole number from 0 to 20
print(fails(draft, ("C"):rep(300) .. ">>C")) --> a side of the reaction has more than 250 atoms
print(fails(draft, "C>>C")) --> the reaction changes nothing
print(fails(draft, "C>>N")) --> no atom of the product comes from the reactants
print(fails(draft, 7)) --> argument 1: reaction SMILES expected, got number
