-- Facts of the trade (common practice, no source): what the standard rules make, and what they refuse.

local failures = 0

local function fail(format, ...)
    failures = failures + 1
    io.stderr:write(string.format(format, ...), "\n")
end

-- The expected products of a transform, most favoured first, as canonical SMILES of the carbon compounds.
local function products(name, ...)
    local reactants = {}
    for i, smiles in ipairs { ... } do reactants[i] = mol(smiles) end
    local list = {}
    for _, set in ipairs(transform(name):forth(table.unpack(reactants))) do
        local names = {}
        for _, product in ipairs(set.products) do names[#names + 1] = product:smiles() end
        list[#list + 1] = { text = table.concat(names, "."), expected = set.expected }
    end
    return list
end

local function gives(name, reactants, product)
    local list = products(name, table.unpack(reactants))
    local wanted = mol(product):smiles()
    if #list == 0 then
        fail("%s: %s gives nothing, expected %s", name, table.concat(reactants, " + "), product)
    elseif list[1].text ~= wanted or not list[1].expected then
        fail("%s: %s gives %s first, expected %s", name, table.concat(reactants, " + "), list[1].text, product)
    end
end

-- A product that the conditions give beside the expected one: listed, and not as expected.
local function rival(name, reactants, product)
    local wanted = mol(product):smiles()
    for _, set in ipairs(products(name, table.unpack(reactants))) do
        if set.text == wanted then
            if set.expected then fail("%s: %s is expected, not a rival", name, product) end
            return
        end
    end
    fail("%s: %s is not listed as a rival", name, product)
end

local function makes(name, product, precursors)
    local wanted = {}
    for i, smiles in ipairs(precursors) do wanted[i] = mol(smiles):smiles() end
    table.sort(wanted)
    for _, step in ipairs(transform(name):back(mol(product))) do
        local names = {}
        for i, precursor in ipairs(step.precursors) do names[i] = precursor:smiles() end
        table.sort(names)
        if table.concat(names, " + ") == table.concat(wanted, " + ") then return end
    end
    fail("%s: %s is not made from %s", name, product, table.concat(precursors, " + "))
end

local function refuses(name, product)
    local steps = transform(name):back(mol(product))
    if #steps > 0 then fail("%s: %s is not refused", name, product) end
end

-- Hydride: a ketone gives a secondary alcohol; aldehyde, ester, acid and acid chloride a primary one.
gives("secondary alcohol from ketone", { "CCC(C)=O" }, "CCC(C)O")
gives("primary alcohol from aldehyde", { "CCCC=O" }, "CCCCO")
gives("primary alcohol from ester", { "CCCC(=O)OC" }, "CCCCO")
gives("primary alcohol from acid", { "CCCC(=O)O" }, "CCCCO")
gives("primary alcohol from acid chloride", { "CCCC(=O)Cl" }, "CCCCO")
refuses("secondary alcohol from ketone", "CC(C)(C)O")

-- Water adds to an unsymmetrical alkene in both directions, by choice of the method.
gives("oxymercuration-demercuration", { "CCCC=C" }, "CCCC(C)O")
rival("oxymercuration-demercuration", { "CCCC=C" }, "CCCCCO")
gives("acid hydration of alkene", { "CC1=CCCCC1" }, "CC1(O)CCCCC1")
gives("hydroboration-oxidation", { "CCCC=C" }, "CCCCCO")
rival("hydroboration-oxidation", { "CCCC=C" }, "CCCC(C)O")
makes("hydroboration-oxidation", "CC1CCCCC1O", { "CC1=CCCCC1" })
refuses("hydroboration-oxidation", "CCCC(C)O")
refuses("oxymercuration-demercuration", "CCCCCO")

-- Cyanide displaces a primary halide, and the chain is one carbon longer; a tertiary halide eliminates.
gives("cyanide displacement", { "CCCCBr", "[Na+].[C-]#N" }, "CCCCC#N")
makes("cyanide displacement", "CCCCC#N", { "CCCCBr", "[Na+].[C-]#N" })
refuses("cyanide displacement", "CC(C)(C)C#N")
-- A secondary centre is inverted.
makes("cyanide displacement inversion", "CCC[C@H](C)C#N", { "CCC[C@@H](C)OS(C)(=O)=O", "[Na+].[C-]#N" })

-- A Grignard reagent with formaldehyde, an aldehyde, a ketone: primary, secondary, tertiary alcohol.
gives("grignard formaldehyde", { "Br[Mg]c1ccccc1", "C=O" }, "OCc1ccccc1")
gives("grignard aldehyde", { "Br[Mg]c1ccccc1", "CC=O" }, "CC(O)c1ccccc1")
gives("grignard ketone", { "Br[Mg]c1ccccc1", "CC(C)=O" }, "CC(C)(O)c1ccccc1")

-- An ester twice takes a Grignard reagent only if both new groups are the same.
refuses("grignard ester twice", "CCC(C)(O)c1ccccc1")
makes("grignard ester twice", "CC(C)(O)c1ccccc1", { "C[Mg]Br", "CCOC(=O)c1ccccc1" })

os.exit(failures == 0 and 0 or 1)
