-- Halides and sulfonates.
-- Yields are typical ranges and sources stand from memory unless a source says otherwise.

pack {
    name = "halides",
    version = "0.1.0",
    licence = "CC0-1.0",
    about = "Halides and sulfonates",
    needs = { "synthons" },
}

-- Two bromines on one side of a ring.
local CIS_DIBROMIDE = { pattern "Br[C@@H]([#6;R])[C@@H]([#6;R])Br", pattern "Br[C@H]([#6;R])[C@H]([#6;R])Br" }

local function is_cis_dibromide(m)
    local a, b = m.atom[1].index, m.atom[3].index
    for _, p in ipairs(CIS_DIBROMIDE) do
        for _, hit in ipairs(m.molecule:find(p)) do
            if (hit[2] == a and hit[4] == b) or (hit[2] == b and hit[4] == a) then return true end
        end
    end
    return false
end

interconversion "bromide-from-alcohol-pbr3" {
    about = "Alkyl bromide from alcohol with phosphorus tribromide; inversion at secondary centres; no rearrangement of primary",
    rxno = "RXNO:0000364",
    target = "[C;X4;H2:1]([#6;!$([C;X4;H0]);!$(C=[O,N]);!$(C#N):3])[Br;X1]",
    from = "[C;X4;H2:1]([#6:3])[O;H1]",
    conditions = "pbr3",
    also_attacks = { "free alcohol", "free acid", "acetal", "silyl ether", "epoxide" },
    recipe = "PBr3, Et2O or CH2Cl2, 0 °C; also: HBr (48 %), H2SO4",
    yield = { 70, 90 },
    cautions = { "phosphorus tribromide" },
    source = "March's Advanced Organic Chemistry; from memory",
    example { "COC(=O)c1ccc(CBr)cc1", from = { "COC(=O)c1ccc(CO)cc1" } },
    refuse { "CC(C)(C)CBr" }, -- neopentyl carbon: SN2 too slow, rearranges
}

interconversion "chloride-from-alcohol-thionyl" {
    about = "Alkyl chloride from alcohol with thionyl chloride; inversion with pyridine, retention (SNi) without base at secondary centres",
    rxno = "RXNO:0000364",
    target = "[C;X4;H2:1]([#6;!$([C;X4;H0]);!$(C=[O,N]);!$(C#N):3])[Cl;X1]",
    from = "[C;X4;H2:1]([#6:3])[O;H1]",
    conditions = "socl2",
    also_attacks = { "free alcohol", "free acid", "primary amine", "secondary amine", "primary amide",
        "oxime" },
    recipe = "SOCl2, CH2Cl2, 0 °C to rt, pyridine or DMF (cat)",
    yield = { 75, 95 },
    cautions = { "thionyl chloride", "pyridine" },
    source = "March's Advanced Organic Chemistry; from memory",
    example { "ClCc1ncccc1C", from = { "OCc1ncccc1C" } },
    refuse { "CC(C)(C)CCl" }, -- neopentyl carbon: substitution too slow
}

interconversion "finkelstein" {
    about = "Finkelstein reaction; inversion; primary, allylic, benzylic only",
    rxno = "RXNO:0000155",
    target = "[C;X4;H2:1]([#6;!$([C;X4;H0]):3])[I;X1]",
    from = "[C;X4;H2:1]([#6:3])[Cl;X1]",
    conditions = "alkylation",
    also_attacks = { "alkyl halide", "acyl halide" },
    recipe = "NaI, acetone, reflux (NaCl or NaBr precipitates); also: Br, OTs",
    yield = { 80, 97 },
    source = "March's Advanced Organic Chemistry; from memory",
    example { "ICCCC(=O)c1ccc(F)cc1", from = { "ClCCCC(=O)c1ccc(F)cc1" } },
    refuse { "CC(C)(C)I" }, -- tertiary centre does not take part in SN2
}

interconversion "hydrobromination-markovnikov" {
    about = "Markovnikov addition of hydrogen bromide; Markovnikov",
    target = "[C;X4;H0:1]([C;X4:3])([C;X4;!H0:5])([Br;X1])[C;X4;H3:4]",
    from = "[C;X3;H0:1]([C;X4:3])([C;X4:5])=[C;X3;H2:4]",
    conditions = "acid-dry-strong",
    also_attacks = { "alkene", "epoxide", "acetal", "silyl ether", "tert-butyl ester", "Boc amine",
        "free alcohol" },
    recipe = "HBr, AcOH or CH2Cl2, 0 °C, radical inhibitor; also: HCl for the chloride",
    yield = { 70, 90 },
    cautions = { "hydrobromic acid" },
    source = "March's Advanced Organic Chemistry; from memory",
    example { "CC1(Br)CCCCC1", from = { "C=C1CCCCC1" } },
    refuse { "CC(Br)C(C)(C)C" }, -- secondary cation beside a quaternary carbon rearranges
}

interconversion "hydrobromination-radical" {
    about = "Radical (anti-Markovnikov) addition of hydrogen bromide; anti-Markovnikov; HBr only (not HCl, HI)",
    target = "[C;X4;H2:1]([Br;X1])[C;X4;H2:3][C;X4:4]",
    from = "[C;X3;H2:1]=[C;X3;H1:3][C;X4:4]",
    conditions = "nbs-radical",
    also_attacks = { "alkene", "alkyne", "thiol", "acetal", "tert-butyl ester" },
    recipe = "HBr, dibenzoyl peroxide, hexane, 0 °C to rt; also: light",
    yield = { 70, 90 },
    cautions = { "hydrobromic acid", "dibenzoyl peroxide" },
    source = "Clayden, Greeves, Warren, Organic Chemistry; from memory",
    example { "COC(=O)CCCCCCCCCCBr", from = { "COC(=O)CCCCCCCCC=C" } },
    refuse { "COC(=O)CCCCCCCCC(C)Br" }, -- Markovnikov isomer needs ionic conditions
}

interconversion "alkene-dibromination" {
    about = "Addition of bromine to an alkene; anti addition: trans dibromide in a ring",
    target = "[C;X4;H1:1]([#6:5])([Br;X1])[C;X4;H1:3]([#6:6])[Br;X1]",
    from = "[C;X3;H1:1]([#6:5])=[C;X3;H1:3][#6:6]",
    when = function(m) return not is_cis_dibromide(m) end,
    conditions = "br2",
    also_attacks = { "alkene", "alkyne", "phenol", "aniline", "ketone", "aldehyde", "thiol", "thioether",
        "enol ether" },
    recipe = "Br2, CH2Cl2 or CHCl3, -20 to 0 °C; also: pyridinium tribromide",
    yield = { 75, 95 },
    cautions = { "bromine" },
    source = "Clayden, Greeves, Warren, Organic Chemistry; from memory",
    example { "Br[C@H]1CC=CC[C@@H]1Br", from = { "C1C=CCC=C1" } },
    refuse { "Br[C@H]1CCCC[C@H]1Br" }, -- cis dibromide of a ring is not formed by anti addition
}

interconversion "alpha-bromo-ketone" {
    about = "Alpha-bromination of an aryl ketone; monobromination in acid; polybromination in base",
    target = "[c:5][C;X3:1](=[O;X1:2])[C;X4;H2:3][Br;X1]",
    from = "[c:5][C;X3:1](=[O;X1:2])[C;X4;H3:3]",
    conditions = "br2",
    also_attacks = { "alkene", "alkyne", "phenol", "aniline", "ketone", "aldehyde", "thioether" },
    recipe = "Br2, AcOH, HBr (cat), rt; also: CuBr2, EtOAc-CHCl3; phenyltrimethylammonium tribromide",
    yield = { 70, 92 },
    cautions = { "bromine", "phenacyl bromide" },
    source = "Clayden, Greeves, Warren, Organic Chemistry; from memory",
    example { "O=C(CBr)c1ccc(cc1)C#N", from = { "O=C(C)c1ccc(cc1)C#N" } },
    refuse { "BrCC(=O)CC" }, -- unsymmetrical dialkyl ketone brominates on the more substituted side in acid
}

disconnection "tosylate-from-alcohol" {
    about = "Tosylation of an alcohol; configuration kept (O-H reacts); primary before secondary",
    target = "[C;X4;H2,H1:1][O;X2:2][S;X4:3](=[O:4])(=[O:5])[c:6]",
    cut = { 3, 2 },
    acceptor = { 3, "sulfonyl" },
    donor = { 2, "alcohol" },
    conditions = "acylation",
    also_attacks = { "primary amine", "secondary amine", "phenol", "thiol", "free alcohol" },
    recipe = "TsCl, pyridine or Et3N, DMAP, CH2Cl2, 0 °C",
    yield = { 80, 95 },
    cautions = { "4-toluenesulfonyl chloride", "pyridine", "4-dimethylaminopyridine" },
    source = "Clayden, Greeves, Warren, Organic Chemistry; from memory",
    example { "Cc1ccc(cc1)S(=O)(=O)OCCOCCN=[N+]=[N-]", from = { "OCCOCCN=[N+]=[N-]", "Cc1ccc(cc1)S(=O)(=O)Cl" } },
    refuse { "CC(C)(C)OS(=O)(=O)c1ccc(C)cc1" }, -- tertiary sulfonates eliminate
}

disconnection "mesylate-from-alcohol" {
    about = "Mesylation of an alcohol; configuration kept (sulfene mechanism)",
    target = "[C;X4;H2,H1:1][O;X2:2][S;X4:3](=[O:4])(=[O:5])[C;H3:6]",
    cut = { 3, 2 },
    acceptor = { 3, "sulfonyl" },
    donor = { 2, "alcohol" },
    conditions = "acylation",
    also_attacks = { "primary amine", "secondary amine", "phenol", "thiol", "free alcohol" },
    recipe = "MsCl, Et3N, CH2Cl2, 0 °C",
    yield = { 85, 98 },
    cautions = { "methanesulfonyl chloride" },
    source = "Clayden, Greeves, Warren, Organic Chemistry; from memory",
    example { "CC(C)(C)OC(=O)N1CCC(CC1)OS(C)(=O)=O", from = { "CC(C)(C)OC(=O)N1CCC(O)CC1", "CS(=O)(=O)Cl" } },
    refuse { "CC(C)(C)OS(C)(=O)=O" }, -- tertiary sulfonates eliminate
}

interconversion "acid-chloride-from-acid" {
    about = "Carboxylic acid to acid chloride conversion; no epimerisation unless alpha-amino or alpha-aryl",
    rxno = "RXNO:0000365",
    target = "[#6:3][C;X3:1](=[O;X1:2])[Cl;X1]",
    from = "[#6:3][C;X3:1](=[O;X1:2])[O;H1]",
    conditions = "socl2",
    also_attacks = { "primary amine", "secondary amine", "free alcohol", "phenol", "thiol", "primary amide" },
    recipe = "(COCl)2, DMF (cat), CH2Cl2, rt; also: SOCl2, reflux",
    yield = { 85, 99 },
    cautions = { "oxalyl chloride", "thionyl chloride" },
    source = "Clayden, Greeves, Warren, Organic Chemistry; from memory",
    example { "O=C(Cl)c1cc(Cl)ncc1F", from = { "O=C(O)c1cc(Cl)ncc1F" } },
    refuse { "COC(=O)Cl" }, -- chloroformate, not an acid chloride
}

interconversion "benzylic-chlorination" {
    about = "Side-chain chlorination; monochlorination at partial conversion",
    target = "[c:1][C;X4;H2:2]Cl",
    from = "[c:1][C;H3:2]",
    conditions = "nbs-radical",
    also_attacks = { "alkene", "other benzylic position", "aldehyde", "primary amine", "free alcohol",
        "thiol" },
    recipe = "SO2Cl2, AIBN, CCl4 or PhCl, reflux; also: Cl2 with light, NCS",
    yield = { 60, 85 },
    cautions = { "sulfuryl chloride", "carbon tetrachloride", "AIBN" },
    source = "Vogel's Textbook of Practical Organic Chemistry; from memory",
    example { "N#Cc1cccc(CCl)c1Cl", from = { "Cc1cccc(C#N)c1Cl" } },
    refuse { "CC(Cl)(Cl)c1ccccc1" }, -- not a primary benzylic chloride
}

interconversion "benzylic-bromide-from-alcohol" {
    about = "Secondary benzylic bromide from the alcohol with hydrogen bromide; SN1, configuration lost",
    target = "[c:2][CX4;H1:1]([#6:3])[BrX1]",
    from = "[c:2][C:1]([#6:3])[OX2H]",
    conditions = "acid-dry-strong",
    also_attacks = { "other alcohol", "acetal", "tert-butyl ether", "alkene" },
    recipe = "HBr (48 % or in AcOH) or PBr3, CH2Cl2, 0 °C to rt",
    yield = { 75, 92 },
    cautions = { "hydrobromic acid" },
    source = "Vogel's Textbook of Practical Organic Chemistry; from memory",
    example { "BrC(c1ccccc1)c1ccccc1", from = { "OC(c1ccccc1)c1ccccc1" } },
    refuse { "BrC1CCCCC1" }, -- not benzylic
}

interconversion "benzal-chloride" {
    about = "Twofold side-chain chlorination of a methylarene",
    target = "[c:1][CX4;H1:2]([ClX1])[ClX1]",
    from = "[c:1][CH3:2]",
    conditions = "nbs-radical",
    also_attacks = { "other methylarene", "alkene", "aldehyde" },
    recipe = "Cl2 (2 eq.), light, reflux",
    yield = { 60, 80 },
    cautions = { "chlorine" },
    source = "common practice, no source",
    example { "ClC(Cl)c1ccccc1", from = { "Cc1ccccc1" } },
    refuse { "ClCc1ccccc1" }, -- one chlorine: benzylic chlorination
}
