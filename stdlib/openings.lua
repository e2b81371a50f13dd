-- Nucleophiles at saturated carbon: epoxides opened by acid and by base, substitution with inversion.
-- Yields are typical ranges and sources stand from memory unless a source says otherwise.

pack {
    name = "openings",
    version = "0.1.0",
    licence = "CC0-1.0",
    about = "Epoxides opened by acid and by base, substitution with inversion",
    needs = { "synthons", "preferences" },
}

local CLAYDEN = "Clayden, Greeves, Warren, Organic Chemistry; from memory"

interconversion "epoxide-opening-by-alcohol-in-acid" {
    about = "Acid-catalysed opening of an epoxide by an alcohol: at the carbon that bears the positive charge better",
    target = "[OX2H:1][CX4;!$(C([OX2])[OX2]):2][CX4;!$(C([OX2])[OX2]):3]-!@[OX2:4]-!@[CX4;H2,H3:5]",
    from = "[O:1]1[C:2][C:3]1.[OX2H:4][C:5]",
    prefer = { "epoxide opening by acid", carbon = 3, nucleophile = 4 },
    conditions = "acid-dry-strong",
    also_attacks = { "epoxide", "acetal", "silyl ether", "alkene", "free alcohol" },
    recipe = "the alcohol, H2SO4 (cat.), rt; also: TsOH, BF3·OEt2",
    yield = { 65, 90 },
    cautions = { "sulfuric acid" },
    source = CLAYDEN,
    example { "COC(C)(C)CO", from = { "CC1(C)CO1", "CO" } },
    example { "COC(CO)c1ccccc1", from = { "C1OC1c1ccccc1", "CO" } },
    refuse { "COCC(C)(C)O" }, -- the less substituted carbon: base
}

interconversion "epoxide-opening-by-alkoxide-at-the-free-end" {
    about = "Opening of an epoxide by an alkoxide: at the less hindered carbon",
    target = "[OX2H:1][CX4;!$(C([OX2])[OX2]):2][CX4;!$(C([OX2])[OX2]):3]-!@[OX2:4]-!@[CX4;H2,H3:5]",
    from = "[O:1]1[C:2][C:3]1.[OX2H:4][C:5]",
    prefer = { "epoxide opening by base", carbon = 3, nucleophile = 4 },
    conditions = "alkoxide",
    also_attacks = { "ester", "alkyl halide", "acyl halide", "aldehyde", "ketone" },
    recipe = "NaOMe, NaOEt or the sodium alkoxide, the alcohol, 25-65 °C",
    yield = { 65, 90 },
    cautions = { "sodium methoxide" },
    source = CLAYDEN,
    example { "COCC(C)(C)O", from = { "CC1(C)CO1", "CO" } },
    refuse { "COC(C)(C)CO" }, -- the more substituted carbon: acid
}

interconversion "ring-epoxide-opening-by-azide" {
    about = "Opening of a ring epoxide by azide; inversion: trans azido alcohol",
    target = "[OX2H:1][C@@H;R:2]([#6;R:5])[C@H;R:3]([#6;R:6])[NX2:7]=[N+:8]=[N-:9]",
    from = "[O:1]1[CH:2]([#6;R:5])[CH:3]1[#6;R:6].[N-:7]=[N+:8]=[N-:9].[Na+]",
    prefer = { "epoxide opening by base", carbon = 3, nucleophile = 7 },
    conditions = "alkylation",
    also_attacks = { "alkyl halide", "acyl halide", "epoxide" },
    recipe = "NaN3, NH4Cl, MeOH-H2O, reflux",
    yield = { 75, 92 },
    cautions = { "sodium azide", "hydrazoic acid" },
    source = CLAYDEN,
    example { "O[C@@H]1CCCC[C@H]1N=[N+]=[N-]", from = { "C1CCC2OC2C1", "[Na+].[N-]=[N+]=[N-]" } },
    refuse { "O[C@H]1CCCC[C@H]1N=[N+]=[N-]" }, -- cis
}

for _, x in ipairs { "Br", "Cl", "I" } do
    interconversion("secondary-cyanide-displacement-" .. x:lower()) {
        about = "Cyanide displacement at a secondary carbon; inversion; elimination is the rival",
        target = "[C@;X4;H1:1]([C;X4:4])([C;X4:5])[C;X2;+0:2]#[N:3]",
        from = "[C@@;X4;H1:1]([C;X4:4])([C;X4:5])" .. x .. ".[C;-:2]#[N:3].[Na+]",
        conditions = "cyanide",
        also_attacks = { "alkyl halide", "acyl halide", "epoxide", "aldehyde" },
        recipe = "NaCN, DMSO, 50-70 °C",
        yield = { 45, 70 },
        cautions = { "sodium cyanide" },
        source = CLAYDEN,
        example { "CCCCCC[C@H](C)C#N", from = { "CCCCCC[C@@H](C)" .. x, "[Na+].[C-]#N" } },
        refuse { "CCC(C)(C)C#N" }, -- tertiary centre: elimination
    }
end
