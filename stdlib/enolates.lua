-- Enolates and carbonyl groups where several places compete: which side, which end, which group.
-- Yields are typical ranges and sources stand from memory unless a source says otherwise.

pack {
    name = "enolates",
    version = "0.1.0",
    licence = "CC0-1.0",
    about = "Kinetic and thermodynamic enolates, dianions, 1,2 and 1,4 additions, selective hydrides",
    needs = { "synthons", "preferences" },
}

local CLAYDEN = "Clayden, Greeves, Warren, Organic Chemistry; from memory"
local ALKYL = "[CX4;H2,H3;!$(C-[O,N,S,F,Cl,Br,I]);!$([CX4][CX4]([CX4])([CX4])[CX4])"
local KETONE = "[#6;!$(C=[O,N,S]);!$(C#N):1][CX3:2](=[OX1:3])"

for _, one in ipairs { { "kinetic", "LDA, THF, -78 °C, then the halide", "base-hindered", "Strong hindered base in the cold: the less substituted side" },
    { "thermodynamic", "KOtBu, tBuOH, or via the thermodynamic silyl enol ether, then the halide", "alkoxide",
        "Weak base: the more substituted side" } } do
    disconnection("ketone-" .. one[1] .. "-alkylation") {
        about = "Alkylation of a ketone. " .. one[4],
        target = KETONE .. "[CX4;!$(C([CX3]=O)[CX3]=O);!$(C(C=O)C#N):4]-!@" .. ALKYL .. ":5]",
        cut = { 5, 4 },
        acceptor = { 5, "alkyl" },
        donor = { 4, "enolate" },
        prefer = { one[1] .. " enolate", carbon = 4, new = 5 },
        conditions = one[3],
        also_attacks = { "alkyl halide", "aldehyde", "acyl halide", "free acid", "free alcohol" },
        recipe = one[2],
        yield = { 55, 85 },
        source = CLAYDEN,
        example { one[1] == "kinetic" and "CC1CCCC(C)C1=O" or "CC1(Cc2ccccc2)CCCCC1=O",
            from = one[1] == "kinetic" and { "CC1CCCCC1=O", "CI" } or { "CC1CCCCC1=O", "BrCc1ccccc1" } },
        refuse { one[1] == "kinetic" and "CC1(CCC)CCCCC1=O" or "CC1CCCC(C)C1=O" }, -- the other side
    }

    interconversion("ketone-" .. one[1] .. "-silyl-enol-ether") {
        about = "Silyl enol ether of a ketone. " .. one[4],
        target = "[#6:1][CX3:2]([OX2:3][Si:5]([CH3:6])([CH3:7])[CH3:8])=[CX3;!$(C[!#6;!#1]):4]",
        from = "[#6:1][C:2](=[O:3])[C;!H0:4].[Si:5]([CH3:6])([CH3:7])([CH3:8])Cl",
        prefer = { one[1] .. " enolate", carbon = 4, new = 2 },
        conditions = one[1] == "kinetic" and "base-hindered" or "silylation",
        also_attacks = { "free alcohol", "free acid", "aldehyde" },
        recipe = one[1] == "kinetic" and "LDA, THF, -78 °C, then TMSCl" or "Et3N, TMSCl, DMF, reflux; TMSI, Et3N",
        yield = { 75, 95 },
        source = CLAYDEN,
        example { one[1] == "kinetic" and "CCC(=C)O[Si](C)(C)C" or "CC=C(C)O[Si](C)(C)C",
            from = { "CCC(C)=O", "C[Si](C)(C)Cl" } },
        refuse { one[1] == "kinetic" and "CC=C(C)O[Si](C)(C)C" or "CCC(=C)O[Si](C)(C)C" },
    }
end

disconnection "dianion-alkylation" {
    about = "Alkylation of the dianion of a 1,3-dicarbonyl compound at the end that was deprotonated last",
    target = "[CX3:1](=[OX1:2])[CX4;H2:3][CX3:4](=[OX1:5])[CX4:6]-!@" .. ALKYL .. ":7]",
    cut = { 7, 6 },
    acceptor = { 7, "alkyl" },
    donor = { 6, "enolate" },
    prefer = { "last deprotonated", carbon = 6, new = 7 },
    conditions = "base-hindered",
    also_attacks = { "alkyl halide", "aldehyde", "acyl halide", "free acid", "free alcohol" },
    recipe = "NaH, then BuLi (dianion), THF, 0 °C, then the halide; also: 2 LDA",
    yield = { 60, 85 },
    cautions = { "sodium hydride", "butyllithium" },
    source = "S. N. Huckin, L. Weiler, J. Am. Chem. Soc. 1974, 96, 1082; from memory",
    example { "CCCCCC(=O)CC(C)=O", from = { "CC(=O)CC(C)=O", "CCCCBr" } },
    refuse { "CCCCC(C(C)=O)C(C)=O" }, -- between the carbonyl groups: one base, one anion
}

interconversion "bromomethyl-ketone" {
    about = "Bromination of a methyl ketone in cold methanol; the less substituted side",
    target = "[CX4:1][CX3:2](=[OX1:3])[CX4;H2:4][BrX1:5]",
    from = "[C:1][C:2](=[O:3])[C;!H0:4]",
    prefer = { "kinetic enolate", carbon = 4, new = 5 },
    conditions = "br2",
    also_attacks = { "alkene", "alkyne", "phenol", "aniline", "other ketone", "aldehyde", "thioether" },
    recipe = "Br2, MeOH, 0 °C, then H2O (ketal hydrolysed by H2SO4)",
    yield = { 70, 90 },
    cautions = { "bromine" },
    source = "M. Gaudry, A. Marquet, Org. Synth. Coll. Vol. 6, 193; from memory",
    example { "CC(C)C(=O)CBr", from = { "CC(C)C(C)=O" } },
    refuse { "CC(=O)C(C)(C)Br" }, -- the more substituted side: acid, warm
}

interconversion "alpha-bromination-acid" {
    about = "Bromination of a ketone in acid; the more substituted side, through the enol; one bromine",
    target = "[CX4:1][CX3:2](=[OX1:3])[CX4;!$(C([Br])[F,Cl,Br,I]):4][BrX1:5]",
    from = "[C:1][C:2](=[O:3])[C;!H0:4]",
    prefer = { "thermodynamic enolate", carbon = 4, new = 5 },
    conditions = "br2",
    also_attacks = { "alkene", "alkyne", "phenol", "aniline", "other ketone", "aldehyde", "thioether" },
    recipe = "Br2, AcOH, HBr (cat), rt to 40 °C",
    yield = { 60, 85 },
    cautions = { "bromine" },
    source = CLAYDEN,
    example { "CC(=O)C(C)(C)Br", from = { "CC(C)C(C)=O" } },
    refuse { "CC(C)C(=O)CBr" }, -- the less substituted side
}

-- ---- 1,2 and 1,4 addition --------------------------------------------------------------------------

disconnection "organolithium-carbonyl-addition" {
    about = "Addition of an organolithium compound to an aldehyde or ketone; 1,2 to enones",
    target = "[CX4;!$(C([OX2H])[!#6;!#1]);$(C[OX2H]):1]([OX2H:2])-!@[#6;$([CX4;!$(C[!#6;!#1])]),$(c):3]",
    cut = { 1, 3 },
    acceptor = { 1, "hydroxyalkyl" },
    donor = { 3, "organolithium" },
    prefer = { "electrophilic carbonyl", carbon = 1, new = 3 },
    conditions = "organolithium",
    also_attacks = { "ester", "amide", "nitrile", "free acid", "free alcohol", "epoxide", "acyl halide" },
    recipe = "MeLi, BuLi, PhLi or ArLi, THF or Et2O, -78 to 0 °C, then H2O",
    yield = { 70, 92 },
    cautions = { "butyllithium" },
    source = CLAYDEN,
    example { "CC1(O)CCCC=C1", from = { "[Li]C", "O=C1CCCC=C1" } },
    refuse { "CC1CCCC(=O)C1" }, -- 1,4: a cuprate
}

-- ---- Hydrides ------------------------------------------------------------------------------------------

for _, one in ipairs { { "methyl", "O[CH3]" }, { "ethyl", "O[CH2][CH3]" } } do
    interconversion("aldehyde-from-" .. one[1] .. "-ester-dibal") {
        about = "One hydride at low temperature stops at the aldehyde; esters of any acid",
        target = "[#6:1][CX3;H1:2]=[OX1:3]",
        from = "[#6:1][C;H0:2](=[O:3])" .. one[2],
        conditions = "dibal",
        also_attacks = { "aldehyde", "ketone", "ester", "free acid", "amide", "nitrile", "acyl halide", "epoxide" },
        recipe = "DIBAL-H (1 equiv), toluene, -78 °C, MeOH, then H3O+",
        yield = { 60, 88 },
        cautions = { "diisobutylaluminium hydride" },
        source = CLAYDEN,
        example { "O=Cc1ccccc1", from = { one[1] == "ethyl" and "CCOC(=O)c1ccccc1" or "COC(=O)c1ccccc1" } },
        refuse { "OCc1ccccc1" }, -- excess hydride, warm
    }
    interconversion("diol-from-keto-" .. one[1] .. "-ester") {
        about = "Aluminium hydride reduces the ketone and the ester of one molecule",
        target = "([CX4;H1:1]([#6:5])([#6:6])[OX2H:2].[CX4;H2:3]([#6:7])[OX2H:4])",
        from = "([C:1]([#6:5])([#6:6])=[O:2].[C:3]([#6:7])(=[O:4])" .. one[2] .. ")",
        conditions = "lialh4",
        also_attacks = { "aldehyde", "ketone", "ester", "free acid", "amide", "nitrile", "epoxide", "acyl halide" },
        recipe = "LiAlH4, Et2O, 0 °C to reflux, then H2O",
        yield = { 75, 92 },
        cautions = { "lithium aluminium hydride" },
        source = CLAYDEN,
        step_cost = 20,
        example { "CC(O)CCCO", from = { one[1] == "ethyl" and "CCOC(=O)CCC(C)=O" or "COC(=O)CCC(C)=O" } },
        refuse { "CC(O)CCC(=O)OCC" }, -- borohydride leaves the ester
    }
end

disconnection "wittig-z-from-ylide" {
    about = "Wittig reaction of a non-stabilised ylide, salt-free in the cold: Z alkene",
    rxno = "RXNO:0000015",
    target = "[#6:1]/[CX3;H1;!R:2]=[CX3;H1;!R:3]\\[CX4;!$(C-[O,N,S,F,Cl,Br,I]):4]",
    cut = { 2, 3 },
    acceptor = { 2, "alkylidene" },
    donor = { 3, "ylide" },
    conditions = "ylide",
    also_attacks = { "free acid", "other aldehyde", "alkyl halide", "acyl halide", "ketone" },
    recipe = "salt-free ylide (NaHMDS), THF, -78 °C to rt",
    yield = { 60, 85 },
    source = CLAYDEN,
    example { "CCCCC/C=C\\CC", from = { "O=CCCCCC", "CCC=P(c1ccccc1)(c1ccccc1)c1ccccc1" } },
    refuse { "CCCCC/C=C/CC" }, -- the E alkene
}
