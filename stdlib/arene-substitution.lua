-- Electrophilic substitution of any arene or heteroarene; where, the reactivity of all its places decides.
-- Yields are typical ranges and sources stand from memory unless a source says otherwise.

pack {
    name = "arene-substitution",
    version = "0.1.0",
    licence = "CC0-1.0",
    about = "Electrophilic substitution of arenes and heteroarenes, the place by their reactivity",
    needs = { "synthons", "preferences" },
}

-- Whether the place is reactive enough: the logarithm of its rate, benzene being 0.
local function at_least(limit)
    return function(m)
        local carbon = m.atom[1]
        for _, near in ipairs(m.molecule:neighbours(carbon.index)) do
            if not near.ring then return m.molecule:rate(carbon.index, "electrophile", near.index, 1) >= limit end
        end
        return false
    end
end

local VOGEL = "Vogel's Textbook of Practical Organic Chemistry; from memory"
local JOULE = "Joule, Mills, Heterocyclic Chemistry; from memory"

interconversion "arene-nitration" {
    about = "Nitration; the most reactive place, ortho and para alike",
    target = "[c:1]-[NX3+:2](=[OX1:3])-[O-:4]",
    from = "[cH:1].O[N+:2](=[O:3])[O-:4]",
    when = at_least(-7.5),
    prefer = { "aromatic electrophilic, small", carbon = 1 },
    conditions = "nitration",
    also_attacks = { "phenol", "primary amine", "secondary amine", "aldehyde", "alkene", "sulfide" },
    recipe = "HNO3, H2SO4 or Ac2O or AcOH, 0-60 °C; fuming HNO3 for deactivated rings",
    yield = { 55, 90 },
    cautions = { "nitric acid", "sulfuric acid" },
    source = VOGEL,
    example { "O=[N+]([O-])c1cccc2ccccc12", from = { "c1ccc2ccccc2c1", "O[N+](=O)[O-]" } },
    example { "[O-][n+]1ccc([N+](=O)[O-])cc1", from = { "[O-][n+]1ccccc1", "O[N+](=O)[O-]" } },
    refuse { "O=[N+]([O-])c1ccc2ccccc2c1" }, -- naphthalene reacts at position 1
}

for _, one in ipairs { { "bromination", "Br", -6.5, "Br2, AcOH; Br2, Fe or FeBr3; NBS, MeCN or DMF", "bromine" },
    { "chlorination", "Cl", -5, "Cl2, FeCl3; SO2Cl2, CH2Cl2; NCS, MeCN", "chlorine" },
    { "iodination", "I", 2.5, "NIS, TFA or MeCN; I2, AgOAc; ICl, AcOH", "iodine monochloride" } } do
    interconversion("arene-" .. one[1]) {
        about = "Halogenation of an arene at its most reactive place; para before ortho",
        target = "[c:1]-[" .. one[2] .. ":2]",
        from = "[cH:1]",
        when = at_least(one[3]),
        prefer = { "aromatic electrophilic", carbon = 1 },
        conditions = "br2",
        also_attacks = { "alkene", "phenol", "primary amine", "sulfide" },
        recipe = one[4],
        yield = { 60, 92 },
        cautions = { one[5] },
        source = VOGEL,
        example { "COc1ccc(" .. one[2] .. ")cc1", from = { "COc1ccccc1" } },
        example { one[2] .. "c1c[nH]c2ccccc12", from = { "c1ccc2[nH]ccc2c1" } },
        refuse { "COc1cccc(" .. one[2] .. ")c1" }, -- meta to the donor
    }
end

interconversion "arene-sulfonation-kinetic" {
    about = "Sulfonation at moderate temperature; the most reactive place (naphthalene: position 1)",
    target = "[c:1]-[SX4:2](=[OX1:3])(=[OX1:4])-[OX2H1:5]",
    from = "[cH:1].[S:2](=[O:3])(=[O:4])=[O:5]",
    when = at_least(-6),
    prefer = { "aromatic electrophilic", carbon = 1 },
    conditions = "so3",
    also_attacks = { "free alcohol", "alkene", "primary amine" },
    recipe = "conc. H2SO4 or oleum, 25-80 °C",
    yield = { 60, 90 },
    cautions = { "oleum", "sulfuric acid" },
    source = VOGEL,
    example { "OS(=O)(=O)c1cccc2ccccc12", from = { "c1ccc2ccccc2c1", "O=S(=O)=O" } },
    refuse { "OS(=O)(=O)c1ccc2ccccc2c1" }, -- the thermodynamic product, at 160 °C
}

disconnection "arene-acylation" {
    about = "Friedel-Crafts acylation; the most reactive place, away from other groups",
    rxno = "RXNO:0000045",
    target = "[c:1]-!@[CX3;!R:2](=[OX1:3])-[#6;!$([#6]=O):4]",
    cut = { 2, 1 },
    acceptor = { 2, "acyl" },
    donor = { 1, "arene" },
    when = at_least(-1),
    prefer = { "aromatic electrophilic, bulky", carbon = 1 },
    conditions = "lewis-acid",
    also_attacks = { "free alcohol", "primary amine", "alkene", "acid-labile acetal" },
    recipe = "AlCl3 (1.1 equiv.), CH2Cl2 or PhNO2, 0-25 °C; SnCl4 for heteroarenes",
    yield = { 60, 92 },
    cautions = { "aluminium chloride" },
    source = "Clayden, Greeves, Warren, Organic Chemistry; from memory",
    example { "CC(=O)c1ccc(C)cc1", from = { "Cc1ccccc1", "CC(=O)Cl" } },
    example { "CC(=O)c1ccco1", from = { "c1ccoc1", "CC(=O)Cl" } },
    refuse { "CC(=O)c1cccc(C)c1" }, -- meta to an alkyl group
}

disconnection "arene-formylation" {
    about = "Vilsmeier-Haack formylation of electron-rich arenes and heteroarenes at their most reactive place",
    rxno = "RXNO:0000055",
    target = "[c:1]-[CX3;H1:2]=[OX1:3]",
    cut = { 2, 1 },
    acceptor = { 2, "formyl" },
    donor = { 1, "arene" },
    when = at_least(3),
    prefer = { "aromatic electrophilic", carbon = 1 },
    conditions = "acylation",
    also_attacks = { "free alcohol", "free acid", "primary amine", "enolisable ketone", "primary amide" },
    recipe = "POCl3, DMF, 0-80 °C, then NaOH",
    yield = { 60, 92 },
    cautions = { "phosphoryl chloride" },
    source = JOULE,
    example { "O=Cc1ccc[nH]1", from = { "c1cc[nH]c1", "CN(C)C=O" } },
    example { "O=Cc1c[nH]c2ccccc12", from = { "c1ccc2[nH]ccc2c1", "CN(C)C=O" } },
    refuse { "O=Cc1cc[nH]c1" }, -- pyrrole reacts at position 2
}
