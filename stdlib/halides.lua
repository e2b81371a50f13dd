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
    addition = { "anti", 1, 3 },
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

interconversion "appel-bromide" {
    about = "Appel bromination with tetrabromomethane; inversion",
    rxno = "RXNO:0000554",
    target = "[C@;X4;H1:1]([C;X4:3])([C;X4:4])[Br;X1]",
    from = "[C@@;X4;H1:1]([C;X4:3])([C;X4:4])[O;H1]",
    conditions = "pbr3",
    also_attacks = { "azide" },
    recipe = "CBr4, PPh3, CH2Cl2, 0 °C to rt",
    yield = { 65, 90 },
    cautions = { "tetrabromomethane", "triphenylphosphine" },
    source = "R. Appel, Angew. Chem. Int. Ed. Engl. 1975, 14, 801; from memory",
    example { "CCOC(=O)C[C@H](C)Br", from = { "CCOC(=O)C[C@@H](C)O" } },
    example { "BrC1CCCCC1", from = { "OC1CCCCC1" } },
    refuse { "CCC(C)(C)Br" }, -- tertiary centre does not take part in SN2
}

interconversion "appel-allylic-chloride" {
    about = "Appel chlorination of an allylic alcohol; no allylic transposition, geometry kept",
    rxno = "RXNO:0000408",
    target = "[C;X4;H2:1]([C;X3:3]=[C;X3:4])[Cl;X1]",
    from = "[C;X4;H2:1]([C;X3:3]=[C;X3:4])[O;H1]",
    conditions = "pbr3",
    also_attacks = { "azide" },
    recipe = "CCl4, PPh3, reflux or MsCl, LiCl, s-collidine, DMF, 0 °C",
    yield = { 75, 90 },
    cautions = { "carbon tetrachloride", "methanesulfonyl chloride", "N,N-dimethylformamide",
        "triphenylphosphine" },
    source = "Org. Synth. Coll. Vol. 6 (geranyl chloride); from memory",
    example { "CC(C)=CCC/C(C)=C/CCl", from = { "CC(C)=CCC/C(C)=C/CO" } },
    example { "C/C=C/CCl", from = { "C/C=C/CO" } },
    refuse { "C=CC(C)(Cl)CCC=C(C)C" }, -- tertiary allylic chloride (SN2′ isomer) is not formed
}

interconversion "iodide-from-alcohol" {
    about = "Iodide from alcohol with iodine and triphenylphosphine (Garegg-Samuelsson); inversion; neighbouring centres kept",
    rxno = "RXNO:0000364",
    target = "[C;X4;H2:1]([C;X4;!H0:3])[I;X1]",
    from = "[C;X4;H2:1]([C;X4:3])[O;H1]",
    conditions = "pbr3",
    also_attacks = { "azide" },
    recipe = "I2, PPh3, imidazole, CH2Cl2, 0 °C",
    yield = { 70, 92 },
    cautions = { "iodine", "triphenylphosphine" },
    source = "Kürti and Czakó, Strategic Applications of Named Reactions in Organic Synthesis; from memory",
    example { "COC(=O)[C@H](CI)NC(=O)OC(C)(C)C", from = { "COC(=O)[C@H](CO)NC(=O)OC(C)(C)C" } },
    example { "CCCCCI", from = { "CCCCCO" } },
    refuse { "CC(C)(C)CI" }, -- neopentyl carbon
}

interconversion "bromide-from-sulfonate" {
    about = "Bromide displacement of a sulfonate; inversion",
    target = "[C@;X4;H1:1]([C;X4:3])([C;X4:4])[Br;X1]",
    from = "[C@@;X4;H1:1]([C;X4:3])([C;X4:4])[O;X2][S;X4](=O)(=O)[C;H3]",
    conditions = "alkylation",
    also_attacks = { "alkyl halide", "epoxide" },
    recipe = "LiBr, acetone or DMF, 50-60 °C; also: tosylate",
    yield = { 70, 90 },
    cautions = { "N,N-dimethylformamide" },
    source = "Larock, Comprehensive Organic Transformations; from memory",
    example { "CCCC[C@H](C)Br", from = { "CCCC[C@@H](C)OS(C)(=O)=O" } },
    example { "BrC1CCCC1", from = { "CS(=O)(=O)OC1CCCC1" } },
    refuse { "CC(C)(C)Br" }, -- tertiary sulfonate cannot be made or displaced
}

interconversion "wohl-ziegler-allylic" {
    about = "Wohl-Ziegler bromination (allylic); allylic C-H; transposed isomer in unsymmetrical alkenes",
    rxno = "RXNO:0000225",
    target = "[C;X4;H1;R:1]([C;X4;R:5])([C;X3;H1;R:3]=[C;X3;H1;R:4])[Br;X1]",
    from = "[C;X4;H2;R:1]([C;X4;R:5])[C;X3;H1;R:3]=[C;X3;H1;R:4]",
    conditions = "nbs-radical",
    also_attacks = { "alkene" },
    recipe = "NBS, dibenzoyl peroxide, CCl4, reflux",
    yield = { 50, 80 },
    cautions = { "N-bromosuccinimide", "carbon tetrachloride", "dibenzoyl peroxide" },
    source = "Kürti and Czakó, Strategic Applications of Named Reactions in Organic Synthesis; from memory",
    example { "BrC1CCCCC=C1", from = { "C1CCCC=CC1" } },
    example { "BrC1CCCC=C1", from = { "C1CCC=CC1" } },
    refuse { "BrC1CCCCC1" }, -- no C=C beside the C-Br carbon
}

interconversion "hell-volhard-zelinsky" {
    about = "Hell-Volhard-Zelinsky reaction; alpha to the acid, racemic",
    rxno = "RXNO:0000621",
    target = "[O;X2;H1:5][C;X3:1](=[O;X1:2])[C;X4;H1:3]([#6;!$(C=O):6])[Br;X1]",
    from = "[O;X2;H1:5][C;X3:1](=[O;X1:2])[C;X4;H2:3][#6:6]",
    conditions = "br2",
    also_attacks = { "ketone", "aldehyde", "free alcohol" },
    recipe = "Br2, PBr3 (cat) or red P, 80-100 °C, then H2O",
    yield = { 65, 90 },
    cautions = { "bromine", "phosphorus tribromide" },
    source = "March's Advanced Organic Chemistry; from memory",
    example { "OC(=O)C(Br)CCc1ccccc1", from = { "OC(=O)CCCc1ccccc1" } },
    example { "CCCC(Br)C(=O)O", from = { "CCCCC(=O)O" } },
    refuse { "OC(=O)CC(Br)C" }, -- bromine is beta, not alpha, to the acid
}

interconversion "haloform-reaction" {
    about = "Haloform reaction; methyl ketone loses its methyl group",
    rxno = "RXNO:0000689",
    target = "[#6;$(c),$([C;X4;H0]([#6])([#6])[#6]),$([C;X3]=C):3][C;X3:1](=[O;X1:2])[O;X2;H1]",
    from = "[#6:3][C;X3:1](=[O;X1:2])[C;X4;H3]",
    conditions = "br2",
    also_attacks = { "free alcohol", "aldehyde" },
    recipe = "NaOCl or NaOBr, H2O-dioxane, 55 °C",
    yield = { 75, 95 },
    cautions = { "sodium hypochlorite" },
    source = "Org. Synth. Coll. Vol. 2, 428 (2-naphthoic acid); from memory",
    example { "OC(=O)c1ccc2ccccc2c1", from = { "CC(=O)c1ccc2ccccc2c1" } },
    example { "OC(=O)C(C)(C)C", from = { "CC(=O)C(C)(C)C" } },
    refuse { "OC(=O)CCC" }, -- enolisable on the other side of the carbonyl as well
}

interconversion "deoxyfluorination-alcohol" {
    about = "Deoxyfluorination of an alcohol; inversion; elimination is the rival",
    target = "[C@;X4;H1:1]([C;X4:3])([C;X4:4])[F;X1]",
    from = "[C@@;X4;H1:1]([C;X4:3])([C;X4:4])[O;H1]",
    conditions = "pbr3",
    also_attacks = { "aldehyde", "ketone" },
    recipe = "DAST, CH2Cl2, -78 °C to rt; also: Deoxo-Fluor",
    yield = { 50, 80 },
    cautions = { "diethylaminosulfur trifluoride" },
    source = "Kürti and Czakó, Strategic Applications of Named Reactions in Organic Synthesis; from memory",
    example { "COC(=O)[C@@H]1C[C@H](F)CN1C(=O)OC(C)(C)C", from = { "COC(=O)[C@@H]1C[C@@H](O)CN1C(=O)OC(C)(C)C" } },
    example { "FC1CCN(CC1)C(=O)OC(C)(C)C", from = { "OC1CCN(CC1)C(=O)OC(C)(C)C" } },
    refuse { "Fc1ccccc1" }, -- fluorine on an arene carbon
}

interconversion "difluoride-from-ketone" {
    about = "gem-Difluoride from a ketone; vinyl fluoride is the rival",
    target = "[C;X4;H0:1]([C;X4:3])([C;X4:4])([F;X1])[F;X1]",
    from = "[C;X3;H0:1]([C;X4:3])([C;X4:4])=[O;X1]",
    conditions = "pbr3",
    also_attacks = { "aldehyde", "ketone" },
    recipe = "DAST, CH2Cl2, rt; also: Deoxo-Fluor",
    yield = { 50, 80 },
    cautions = { "diethylaminosulfur trifluoride" },
    source = "Kürti and Czakó, Strategic Applications of Named Reactions in Organic Synthesis; from memory",
    example { "FC1(F)CCN(CC1)C(=O)OC(C)(C)C", from = { "O=C1CCN(CC1)C(=O)OC(C)(C)C" } },
    example { "FC1(F)CCCCC1", from = { "O=C1CCCCC1" } },
    refuse { "FC(F)(F)CC" }, -- trifluoromethyl group is not made from a ketone
}

interconversion "bromodecarboxylation" {
    about = "Hunsdiecker reaction; radical: configuration lost",
    rxno = "RXNO:0000106",
    target = "[C;X4;H2,H1;!$(C[#7,#8,#16]):1]([C;X4:3])[Br;X1]",
    from = "[C;X4:1]([C;X4:3])[C;X3](=O)[O;H1]",
    conditions = "br2",
    also_attacks = { "aldehyde", "free alcohol" },
    recipe = "Ag2O then Br2, CCl4, reflux; also: HgO, Br2 (Cristol-Firth)",
    yield = { 50, 70 },
    cautions = { "bromine", "carbon tetrachloride" },
    source = "Org. Synth. Coll. Vol. 3 (methyl 5-bromovalerate); from memory",
    example { "COC(=O)CCCCBr", from = { "COC(=O)CCCCC(=O)O" } },
    example { "BrC1CC1", from = { "OC(=O)C1CC1" } },
    refuse { "Brc1ccccc1" }, -- arene carbon: decarboxylation of the aroyloxy radical is slow
}

interconversion "allylic-bromide-transposed" {
    about = "Primary allylic bromide from a tertiary allylic alcohol; transposition to the primary halide, E:Z about 2:1 to 4:1",
    rxno = "RXNO:0000364",
    target = "[#6:4][C;X3;H0:1]([#6:5])=[C;X3;H1:2][C;X4;H2:3][Br]",
    from = "[#6:4][C:1](O)([#6:5])[C;H1:2]=[C;H2:3]",
    conditions = "pbr3",
    also_attacks = { "tertiary alcohol", "silyl ether" },
    recipe = "PBr3, Et2O, 0 °C; also: 48% HBr, HCl for the chloride",
    yield = { 70, 90 },
    cautions = { "phosphorus tribromide" },
    source = "Vogel's Textbook of Practical Organic Chemistry; from memory",
    example { "CC(=O)OC(C)CCC(C)=CCBr", from = { "CC(=O)OC(C)CCC(C)(O)C=C" } },
    example { "CC(C)=CCBr", from = { "CC(C)(O)C=C" } },
    refuse { "C=CCBr" }, -- no alkyl group on the far carbon
}

interconversion "allylic-chloride-transposed" {
    about = "Primary allylic chloride from a tertiary allylic alcohol; transposition to the primary halide, E preferred",
    rxno = "RXNO:0000364",
    target = "[#6:4][C;X3;H0:1]([#6:5])=[C;X3;H1:2][C;X4;H2:3]Cl",
    from = "[#6:4][C:1](O)([#6:5])[C;H1:2]=[C;H2:3]",
    conditions = "acid-aq-strong",
    also_attacks = { "other alcohol" },
    recipe = "conc. HCl, 0-20 °C; also: SOCl2/pyridine, PCl3",
    yield = { 65, 88 },
    cautions = { "hydrochloric acid" },
    source = "Vogel's Textbook of Practical Organic Chemistry; from memory",
    example { "CC(C)=CCCC(C)=CCCl", from = { "CC(C)=CCCC(C)(O)C=C" } },
    example { "CC(C)=CCCl", from = { "CC(C)(O)C=C" } },
    refuse { "C=CCCl" }, -- no alkyl group on the far carbon
}

interconversion "benzylic-chloride-from-secondary-alcohol" {
    about = "Secondary benzylic chloride from the alcohol",
    target = "[CX4;H1;$(C(-c)):1](-[#6;c,CX4:2])[ClX1]",
    from = "[C:1](-[#6:2])[OH]",
    conditions = "socl2",
    also_attacks = { "other alcohol", "free acid", "primary amide" },
    recipe = "SOCl2, CH2Cl2 or toluene, 0 °C to rt; or conc. HCl",
    yield = { 80, 97 },
    cautions = { "thionyl chloride" },
    source = "Vogel's Textbook of Practical Organic Chemistry; from memory",
    example { "CN(C)CCC(Cl)c1ccccc1", from = { "CN(C)CCC(O)c1ccccc1" } },
    example { "ClC(c1ccccc1)c1ccccc1", from = { "OC(c1ccccc1)c1ccccc1" } },
    refuse { "CC(Cl)C" }, -- no aryl group
}

interconversion "alpha-bromo-ketone-substituted" {
    about = "α-Bromination of an aryl ketone at a CH2 or CH",
    target = "[c:5][CX3:1](=[OX1:2])[CX4;H0,H1:3]([CX4:4])[BrX1]",
    from = "[c:5][C:1](=[O:2])[C:3][C:4]",
    conditions = "br2",
    also_attacks = { "alkene", "alkyne", "phenol", "aniline", "other ketone", "aldehyde" },
    recipe = "Br2, AcOH or CH2Cl2, cat. HBr; also: CuBr2, EtOAc; NBS",
    yield = { 75, 95 },
    cautions = { "bromine" },
    source = "Vogel's Textbook of Practical Organic Chemistry; from memory",
    example { "CC(Br)C(=O)c1cccc(Cl)c1", from = { "CCC(=O)c1cccc(Cl)c1" } },
    example { "O=C(c1ccccc1Cl)C1(Br)CCCC1", from = { "O=C(c1ccccc1Cl)C1CCCC1" } },
    refuse { "CCC(=O)CBr" }, -- not an aryl ketone
}

interconversion "adamantane-bromination" {
    about = "Bromination of adamantane at a bridgehead",
    target = "[BrX1][CX4;H0;$(C12CC3CC(CC(C3)C1)C2),$(C1(Br)CC2CC(C1)CC(C2)):1]",
    from = "[C:1]",
    conditions = "br2",
    also_attacks = { "alkene", "alcohol", "amine", "aldehyde" },
    recipe = "Br2 (neat), reflux; cat. Fe for more than one",
    yield = { 80, 95 },
    cautions = { "bromine" },
    source = "Stetter, Schwarz, Hirschhorn, Chem. Ber. 1959, 92, 1629; from memory",
    example { "BrC12CC3CC(CC(C3)C1)C2", from = { "C1C2CC3CC1CC(C3)C2" } },
    refuse { "CC(C)(C)Br" }, -- not a bridgehead
}

disconnection "ritter-bromide" {
    about = "Acetamide from a tertiary bromide and acetonitrile (Ritter reaction)",
    target = "[CX4;H0:1]-!@[NX3;H1:2]-[CX3:3](=[OX1])-[CH3:5]",
    from = "[C:1]Br.[N:2]#[C:3][C:5]",
    conditions = "acid-aq-strong",
    also_attacks = { "alcohol", "alkene", "acetal", "tert-butyl ester" },
    recipe = "MeCN, conc. H2SO4, rt to 50 °C",
    yield = { 70, 92 },
    cautions = { "sulfuric acid" },
    source = "Stetter, Mayer, Schwarz, Wulff, Chem. Ber. 1960, 93, 226; from memory",
    example { "CC(=O)NC12CC3CC(CC(C3)C1)C2", from = { "BrC12CC3CC(CC(C3)C1)C2", "CC#N" } },
    example { "CC(=O)NC(C)(C)C", from = { "CC(C)(C)Br", "CC#N" } },
    refuse { "CC(=O)NCC" }, -- a primary carbon
}

interconversion "trityl-chloride" {
    about = "Triarylmethyl chloride from the carbinol",
    target = "[CX4;H0:1](-[c:2])(-[c:3])(-[c:4])-[ClX1]",
    from = "[C:1](-[c:2])(-[c:3])(-[c:4])[OH]",
    conditions = "socl2",
    also_attacks = { "alcohol", "free acid", "primary amide" },
    recipe = "SOCl2 or AcCl, toluene, 50-80 °C",
    yield = { 85, 97 },
    cautions = { "thionyl chloride" },
    source = "Bachmann, Org. Synth. Coll. Vol. 3, 841; from memory",
    example { "ClC(c1ccccc1)(c1ccccc1)c1ccccc1Cl", from = { "OC(c1ccccc1)(c1ccccc1)c1ccccc1Cl" } },
    example { "ClC(c1ccccc1)(c1ccccc1)c1ccccc1", from = { "OC(c1ccccc1)(c1ccccc1)c1ccccc1" } },
    refuse { "CC(C)(Cl)c1ccccc1" }, -- one aryl group only
}
