-- Alcohols, diols and epoxides: reductions, hydrations, oxidations of alkenes.
-- Yields are typical ranges and sources stand from memory unless a source says otherwise.

pack {
    name = "alcohols",
    version = "0.1.0",
    licence = "CC0-1.0",
    about = "Alcohols, diols and epoxides: reductions, hydrations, oxidations of alkenes",
    needs = { "synthons", "preferences" },
}

-- Two neighbouring ring carbons with a hydroxyl group each, on one side or on both sides of the ring.
local CIS_DIOL = { pattern "O[C@@H]([#6;R])[C@@H]([#6;R])O", pattern "O[C@H]([#6;R])[C@H]([#6;R])O" }
local TRANS_DIOL = { pattern "O[C@@H]([#6;R])[C@H]([#6;R])O", pattern "O[C@H]([#6;R])[C@@H]([#6;R])O" }

-- A trans epoxide with both centres marked, and the diol that syn addition to an E alkene gives.
local TRANS_EPOXIDE = { pattern "[#6;!r3][C@@H]1O[C@H]1[#6;!r3]", pattern "[#6;!r3][C@H]1O[C@@H]1[#6;!r3]" }
local SYN_DIOL = { pattern "[#6][C@@H]([OH])[C@H]([OH])c", pattern "[#6][C@H]([OH])[C@@H]([OH])c" }

-- A ring alcohol with an alkyl group beside it on the same side, which syn addition of H and OH cannot give.
local CIS_ALKYL = { pattern "O[C@@H]([#6;R])[C@@H]([#6;R])[#6;!R]", pattern "O[C@H]([#6;R])[C@H]([#6;R])[#6;!R]" }

-- Whether one of the patterns lies on atoms a and b with its members i and k.
local function lies(m, patterns, i, k, a, b)
    for _, p in ipairs(patterns) do
        for _, hit in ipairs(m.molecule:find(p)) do
            if (hit[i] == a and hit[k] == b) or (hit[i] == b and hit[k] == a) then return true end
        end
    end
    return false
end

local MARKED_CARBINOL = { pattern "c[C@H](C)[OH]", pattern "c[C@@H](C)[OH]" }
local function is_marked_carbinol(m) return lies(m, MARKED_CARBINOL, 1, 2, m.atom[3].index, m.atom[1].index) end
local function is_trans_epoxide(m) return lies(m, TRANS_EPOXIDE, 2, 4, m.atom[1].index, m.atom[3].index) end
local function is_syn_diol(m) return lies(m, SYN_DIOL, 2, 4, m.atom[1].index, m.atom[3].index) end

interconversion "secondary-alcohol-from-ketone" {
    about = "Ketone reduction with sodium borohydride; hydride from the less hindered face; racemic in open chains; ester survives",
    target = "[C;X4;H1:1]([#6:3])([#6:4])[O;X2;H1:2]",
    from = "[C;X3;H0:1](=[O;X1;H0:2])([#6:3])[#6:4]",
    conditions = "nabh4",
    also_attacks = { "aldehyde", "ketone", "acyl halide" },
    recipe = "NaBH4, MeOH, 0 °C to rt; also: LiBH4, L-Selectride (axial alcohol)",
    yield = { 85, 98 },
    cautions = { "sodium borohydride" },
    source = "Clayden, Greeves, Warren, Organic Chemistry; from memory",
    example { "COC(=O)c1ccc(cc1)C(C)O", from = { "COC(=O)c1ccc(cc1)C(C)=O" } },
    example { "OC1CCCCC1", from = { "O=C1CCCCC1" } },
    refuse { "CCC(C)(C)O" }, -- tertiary alcohol has no H on the carbinol carbon
}

interconversion "primary-alcohol-from-aldehyde" {
    about = "Aldehyde reduction with sodium borohydride; aldehyde before ketone at low temperature; nitro and ester survive",
    target = "[C;X4;H2:1]([#6:3])[O;X2;H1:2]",
    from = "[C;X3;H1:1]([#6:3])=[O;X1;H0:2]",
    conditions = "nabh4",
    also_attacks = { "aldehyde", "ketone", "acyl halide" },
    recipe = "NaBH4, EtOH, 0 °C",
    yield = { 85, 98 },
    cautions = { "sodium borohydride" },
    source = "Clayden, Greeves, Warren, Organic Chemistry; from memory",
    example { "OCc1ccc(cc1)[N+](=O)[O-]", from = { "O=Cc1ccc(cc1)[N+](=O)[O-]" } },
    example { "OCc1ccccc1", from = { "O=Cc1ccccc1" } },
    refuse { "CC(O)c1ccccc1" }, -- secondary alcohol comes from a ketone
}

interconversion "primary-alcohol-from-acid" {
    about = "Carboxylic acid to primary alcohol reduction (borane); acid before ester and nitro",
    rxno = "RXNO:0000431",
    target = "[C;X4;H2:1]([#6:3])[O;X2;H1:2]",
    from = "[C;X3;H0:1]([#6:3])(=[O;X1;H0:2])[O;H1]",
    when = function(m) return m.molecule:count "[OX2H1]" <= 3 end,
    conditions = "borane",
    also_attacks = { "alkene", "alkyne", "aldehyde", "ketone", "amide", "nitrile", "imine" },
    recipe = "BH3·THF, THF, 0 °C to rt; also: BH3·SMe2; mixed anhydride then NaBH4",
    yield = { 75, 95 },
    cautions = { "borane-tetrahydrofuran complex" },
    source = "Carey and Sundberg, Advanced Organic Chemistry, Part B; from memory",
    example { "OCc1cccc(c1)C(=O)OC", from = { "OC(=O)c1cccc(c1)C(=O)OC" } },
    example { "OCCc1ccccc1", from = { "OC(=O)Cc1ccccc1" } },
    refuse { "CC(C)O" }, -- secondary alcohol cannot come from an acid without a new C-C bond
}

interconversion "primary-alcohol-from-ester" {
    about = "Ester reduction with lithium aluminium hydride; goes through to the alcohol; isolated C=C survives",
    target = "[C;X4;H2:1]([#6:3])[O;X2;H1:2]",
    from = "[C;X3;H0:1]([#6:3])(=[O;X1;H0:2])[O;X2;H0][C;H3]",
    when = function(m) return m.molecule:count "[OX2H1]" <= 3 end,
    conditions = "lialh4",
    also_attacks = { "aldehyde", "ketone", "ester", "free acid", "amide", "nitrile", "epoxide", "acyl halide",
        "alkyl halide", "nitro", "azide" },
    recipe = "LiAlH4, THF, 0 °C to reflux; also: ethyl ester; LiBH4 (spares amide, acid)",
    yield = { 80, 97 },
    cautions = { "lithium aluminium hydride" },
    source = "Clayden, Greeves, Warren, Organic Chemistry; from memory",
    example { "OCc1cc2ccccc2[nH]1", from = { "COC(=O)c1cc2ccccc2[nH]1" } },
    example { "OCc1ccncc1", from = { "COC(=O)c1ccncc1" } },
    refuse { "OC(C)(C)c1cc2ccccc2[nH]1" }, -- tertiary alcohol from an ester needs a carbon nucleophile
}

interconversion "luche-reduction" {
    about = "Luche reduction; 1,2 (not 1,4) reduction; equatorial alcohol in cyclohexenones",
    rxno = "RXNO:0000286",
    target = "[C;X4;H1:1]([#6:5])([C;X3:3]=[C;X3:4])[O;X2;H1:2]",
    from = "[C;X3;H0:1]([#6:5])([C;X3:3]=[C;X3:4])=[O;X1;H0:2]",
    conditions = "nabh4",
    also_attacks = { "ketone", "acyl halide" },
    recipe = "NaBH4, CeCl3·7H2O, MeOH, 0 °C",
    yield = { 85, 98 },
    cautions = { "sodium borohydride" },
    source = "J.-L. Luche, J. Am. Chem. Soc. 1978, 100, 2226; from memory",
    example { "CC1=CC[C@@H](CC1O)C(C)=C", from = { "CC1=CC[C@@H](CC1=O)C(C)=C" } },
    example { "OC1C=CCCC1", from = { "O=C1C=CCCC1" } },
    refuse { "OC1CCCCC1" }, -- no C=C next to the carbinol carbon
}

interconversion "oxymercuration-demercuration" {
    about = "Oxymercuration-demercuration; Markovnikov, no rearrangement",
    target = "[CX4;H0,H1;!$(C[!#6;!#1;!$([OX2H])]):1]([OX2H:3])[CX4;!H0;!$(C[!#6;!#1]):2]",
    from = "[C:1]=[C:2]",
    when = function(m) return m.atom[1].carbons > m.atom[2].carbons end,
    prefer = { "markovnikov", carbon = 1 },
    conditions = "oxymercuration",
    also_attacks = { "alkene", "alkyne" },
    recipe = "Hg(OAc)2, THF-H2O, then NaBH4, NaOH",
    yield = { 75, 95 },
    cautions = { "mercury(II) acetate", "sodium borohydride", "sodium hydroxide" },
    source = "H. C. Brown and P. J. Geoghegan, oxymercuration-demercuration papers; from memory",
    example { "CC(O)C(C)(C)C", from = { "C=CC(C)(C)C" } },
    example { "CCCCC(C)O", from = { "CCCCC=C" } },
    refuse { "OCCC(C)(C)C" }, -- anti-Markovnikov alcohol: use hydroboration
}

interconversion "acid-hydration-of-alkene" {
    about = "Acid-catalysed hydration of an alkene; Markovnikov; only where the cation is tertiary",
    target = "[CX4;H0;!$(C[!#6;!#1;!$([OX2H])]):1]([OX2H:3])[CX4;!H0;!$(C[!#6;!#1]):2]",
    from = "[C:1]=[C:2]",
    when = function(m) return m.atom[1].carbons > m.atom[2].carbons end,
    prefer = { "markovnikov", carbon = 1 },
    conditions = "acid-aq-strong",
    also_attacks = { "alkene", "epoxide", "acetal", "silyl ether", "free alcohol", "Boc amine",
        "tert-butyl ester" },
    recipe = "H2SO4 (aq, 50-65 %), 0-25 °C; also: the internal alkene isomer",
    yield = { 50, 80 },
    cautions = { "sulfuric acid" },
    source = "March's Advanced Organic Chemistry; from memory",
    example { "CC1(O)CCN(CC1)C(=O)c1ccccc1", from = { "C=C1CCN(CC1)C(=O)c1ccccc1" } },
    example { "CC1(O)CCCCC1", from = { "C=C1CCCCC1" } },
    refuse { "CC(O)C(C)(C)C" }, -- secondary cation beside a quaternary carbon rearranges (gives 2,3-dimethylbutan-2-ol)
}

interconversion "hydroboration-oxidation" {
    about = "Hydroboration-oxidation; anti-Markovnikov",
    rxno = "RXNO:0000293",
    also = { "hydroboration-oxidation-trisubstituted" },
    target = "[CX4;H1,H2;!$(C[!#6;!#1;!$([OX2H])]):1]([OX2H:3])[CX4;!H0;!$(C[!#6;!#1]):2]",
    from = "[C:1]=[C:2]",
    when = function(m)
        return m.atom[1].carbons < m.atom[2].carbons
            and not lies(m, CIS_ALKYL, 2, 4, m.atom[1].index, m.atom[2].index)
    end,
    prefer = { "anti-markovnikov", carbon = 1, hydrogen = 2 },
    addition = { "syn", 1, 2 },
    conditions = "borane",
    also_attacks = { "alkene", "alkyne", "aldehyde", "ketone", "free acid" },
    recipe = "9-BBN or BH3·THF, THF, then H2O2, NaOH; also: BH3·SMe2, Cy2BH",
    yield = { 75, 95 },
    cautions = { "borane-tetrahydrofuran complex", "hydrogen peroxide", "sodium hydroxide" },
    source = "H. C. Brown, hydroboration papers; from memory",
    example { "OCCC1CCN(CC1)C(=O)OC(C)(C)C", from = { "C=CC1CCN(CC1)C(=O)OC(C)(C)C" } },
    example { "C[C@@H]1CCCC[C@H]1O", from = { "CC1=CCCCC1" } },
    refuse { "OCC(C)(C)C" }, -- carbon beside the carbinol carbon carries no H, so no alkene precursor
}

interconversion "benzylic-halide-hydrolysis" {
    about = "Hydrolysis of a benzylic halide; substitution at the benzylic carbon",
    target = "[C;X4;H2:1]([c:3])[O;X2;H1]",
    from = "[C;X4;H2:1]([c:3])[Br;X1]",
    conditions = "base-aq-mild",
    also_attacks = { "alkyl halide", "acyl halide" },
    recipe = "CaCO3, dioxane-H2O, reflux; also: Cl, I; NaOAc then K2CO3, MeOH",
    yield = { 70, 95 },
    source = "Larock, Comprehensive Organic Transformations; from memory",
    example { "OCc1ccc(cc1)C#N", from = { "BrCc1ccc(cc1)C#N" } },
    example { "OCc1ccc([N+](=O)[O-])cc1", from = { "BrCc1ccc([N+](=O)[O-])cc1" } },
    refuse { "OCCc1ccccc1" }, -- not benzylic: hydroxide would eliminate as well
}

interconversion "syn-dihydroxylation" {
    about = "Osmium-catalysed dihydroxylation (Upjohn); syn addition: cis diol in a ring; from the less hindered face",
    target = "[C;X4;H1;R:1]([#6;R:5])([O;X2;H1])[C;X4;H1;R:3]([#6;R:6])[O;X2;H1]",
    from = "[C;X3;H1;R:1]([#6;R:5])=[C;X3;H1;R:3][#6;R:6]",
    when = function(m) return not lies(m, TRANS_DIOL, 2, 4, m.atom[1].index, m.atom[3].index) end,
    addition = { "syn", 1, 3 },
    conditions = "oso4",
    also_attacks = { "primary amine", "secondary amine", "alkene", "thiol", "thioether" },
    recipe = "OsO4 (cat), NMO, acetone-H2O, rt; also: K2OsO4",
    yield = { 75, 95 },
    cautions = { "osmium tetroxide" },
    source = "V. VanRheenen, R. C. Kelly and D. Y. Cha, Tetrahedron Lett. 1976, 1973; from memory",
    example { "O[C@H]1CN(C[C@H]1O)C(=O)OCc1ccccc1", from = { "C1C=CCN1C(=O)OCc1ccccc1" } },
    example { "O[C@H]1CCCC[C@H]1O", from = { "C1=CCCCC1" } },
    refuse { "O[C@@H]1CCCC[C@H]1O" }, -- trans diol of a ring is not formed by syn addition
}

interconversion "terminal-dihydroxylation" {
    about = "Dihydroxylation of a terminal alkene; racemic; terminal before trisubstituted only by sterics, electron-rich alkene first",
    target = "[C;X4;H1:1]([#6;!$(C=[O,N]):5])([O;X2;H1])[C;X4;H2:3][O;X2;H1]",
    from = "[C;X3;H1:1]([#6:5])=[C;X3;H2:3]",
    conditions = "oso4",
    also_attacks = { "alkene", "thiol", "thioether" },
    recipe = "OsO4 (cat), NMO, acetone-H2O, rt; also: K2OsO4, K3Fe(CN)6",
    yield = { 75, 95 },
    cautions = { "osmium tetroxide" },
    source = "V. VanRheenen, R. C. Kelly and D. Y. Cha, Tetrahedron Lett. 1976, 1973; from memory",
    example { "OCC(O)CCC(=O)OC(C)(C)C", from = { "C=CCCC(=O)OC(C)(C)C" } },
    example { "CCCCC(O)CO", from = { "CCCCC=C" } },
    refuse { "OCCCO" }, -- 1,3-diol
}

interconversion "prilezhaev-epoxidation" {
    about = "Prilezhaev epoxidation; syn, stereospecific; the more electron-rich alkene first",
    rxno = "RXNO:0000405",
    target = "[C;X4;r3;!$(C[C,S]=O);!$(CC#N):1]1[O;X2;r3][C;X4;r3;!$(C[C,S]=O);!$(CC#N):3]1",
    from = "[C;X3:1]=[C;X3:3]",
    addition = { "syn", 1, 3 },
    prefer = { "electron-rich alkene", first = 1, second = 3 },
    conditions = "mcpba",
    also_attacks = { "alkene", "primary amine", "secondary amine", "tertiary amine", "thiol", "thioether",
        "imine", "aldehyde" },
    recipe = "mCPBA, NaHCO3, CH2Cl2, 0 °C; also: dimethyldioxirane",
    yield = { 75, 95 },
    cautions = { "3-chloroperbenzoic acid" },
    source = "Clayden, Greeves, Warren, Organic Chemistry; from memory",
    example { "CC(=O)OC/C=C(\\C)CCC1OC1(C)C", from = { "CC(=O)OC/C=C(\\C)CCC=C(C)C" } },
    example { "C1CCC2OC2C1", from = { "C1=CCCCC1" } },
    refuse { "CC1OC1C(C)=O" }, -- alkene conjugated to C=O is too electron-poor for a peracid (use H2O2, NaOH)
}

interconversion "chlorohydrin-formation" {
    about = "Chlorohydrin from an alkene; anti addition; OH on the carbon that bears positive charge better",
    target = "[C;X4;H2:1]([Cl;X1])[C;X4;H1:3]([c:5])[O;X2;H1]",
    from = "[C;X3;H2:1]=[C;X3;H1:3][c:5]",
    conditions = "acid-aq-mild",
    also_attacks = { "alkene", "phenol", "aniline", "thiol", "thioether", "primary amine",
        "secondary amine" },
    recipe = "NCS, H2O-acetone, rt; also: NaOCl, AcOH; NBS, H2O-DMSO for the bromohydrin",
    yield = { 60, 85 },
    cautions = { "N-chlorosuccinimide" },
    source = "March's Advanced Organic Chemistry; from memory",
    example { "OC(CCl)c1ccc(Cl)cc1", from = { "C=Cc1ccc(Cl)cc1" } },
    example { "OC(CCl)c1ccccc1", from = { "C=Cc1ccccc1" } },
    refuse { "OCC(Cl)c1ccccc1" }, -- water attacks the more substituted (benzylic) carbon, halogen ends terminal
}

interconversion "anti-diol-from-epoxide" {
    about = "Epoxide hydrolysis to an anti diol; inversion at the attacked carbon: trans diol in a ring",
    target = "[O;X2;H1:2][C;X4;H1:1]([#6:5])[C@@;X4;H1:3]([#6:6])[O;X2;H1]",
    from = "[O;X2;H0:2]1[C;X4;H1:1]([#6:5])[C@@;X4;H1:3]1[#6:6]",
    when = function(m) return not lies(m, CIS_DIOL, 2, 4, m.atom[1].index, m.atom[3].index) end,
    conditions = "acid-aq-mild",
    also_attacks = { "epoxide", "acetal", "silyl ether", "alkene" },
    recipe = "H2SO4 (cat) or HClO4, H2O-THF; also: KOH, DMSO-H2O, heat",
    yield = { 70, 90 },
    cautions = { "sulfuric acid" },
    source = "Clayden, Greeves, Warren, Organic Chemistry; from memory",
    example { "O[C@@H]1CCCC[C@H]1O", from = { "C1CC[C@H]2O[C@H]2C1" } },
    example { "O[C@@H]1CCC[C@H]1O", from = { "C1C[C@H]2O[C@H]2C1" } },
    refuse { "O[C@@H]1CCCC[C@@H]1O" }, -- cis diol of a ring is not formed by back-side opening
}

interconversion "alcohol-from-ester-hydrolysis" {
    about = "Ester hydrolysis giving an alcohol; C-O bond of the alcohol and its configuration kept",
    target = "[C;X4;H1;R;!$([CX4]-[CX4;!H0]-[CX3;!$(C-[O,N])]=[OX1]);!$([CX4]-[CX4]-[NX3;H1,H2;+0;!$(N-[C,S]=[O,S,N]);!$(N-c)]):1]([C;X4:3])([C;X4:4])[O;X2;H1:2]",
    from = "[C;X4;H1;R:1]([C;X4:3])([C;X4:4])[O;X2;H0:2][C;X3](=O)c1ccccc1",
    conditions = "base-aq-mild",
    also_attacks = { "ester", "acyl halide", "anhydride" },
    recipe = "K2CO3, MeOH, rt; also: LiOH, THF-H2O; acetate, formate",
    yield = { 85, 98 },
    source = "Clayden, Greeves, Warren, Organic Chemistry; from memory",
    example { "OC1CCN(CC1)c1ncccn1", from = { "O=C(OC1CCN(CC1)c1ncccn1)c1ccccc1" } },
    example { "OC1CCCCC1", from = { "O=C(OC1CCCCC1)c1ccccc1" } },
    refuse { "Oc1ccccc1" }, -- phenol, not an alcohol on sp3 carbon
}

interconversion "primary-alcohol-from-acid-chloride" {
    about = "Acid chloride reduction to the primary alcohol; excess hydride, the aldehyde is passed through",
    target = "[CX4;H2:1]([#6:3])[OX2;H1:2]",
    from = "[C:1]([#6:3])(=[O:2])Cl",
    conditions = "lialh4",
    also_attacks = { "ester", "aldehyde", "ketone", "nitrile", "amide", "epoxide", "free acid" },
    recipe = "LiAlH4, Et2O, 0 °C; or NaBH4 (excess), THF-DMF, 0 °C",
    yield = { 80, 95 },
    cautions = { "lithium aluminium hydride" },
    source = "Nystrom, Brown, J. Am. Chem. Soc. 1947, 69, 1197; from memory",
    example { "CCCCCCCCO", from = { "CCCCCCCC(=O)Cl" } },
    example { "OCc1ccccc1", from = { "O=C(Cl)c1ccccc1" } },
    refuse { "CC(C)O" }, -- a secondary alcohol
}

interconversion "primary-alcohol-from-ethyl-ester" {
    about = "Ethyl ester reduction with lithium aluminium hydride",
    target = "[CX4;H2:1]([#6:3])[OX2;H1:2]",
    from = "[C:1]([#6:3])(=[O:2])O[CH2][CH3]",
    when = function(m) return m.molecule:count "[OX2H1]" <= 3 end,
    conditions = "lialh4",
    also_attacks = { "other ester", "aldehyde", "ketone", "nitrile", "amide", "epoxide", "free acid", "nitro" },
    recipe = "LiAlH4, THF or Et2O, 0 °C to rt",
    yield = { 80, 95 },
    cautions = { "lithium aluminium hydride" },
    source = "Nystrom, Brown, J. Am. Chem. Soc. 1947, 69, 1197; from memory",
    example { "OCc1cccnc1", from = { "CCOC(=O)c1cccnc1" } },
    example { "OCCc1ccccc1", from = { "CCOC(=O)Cc1ccccc1" } },
    refuse { "CC(C)O" }, -- a secondary alcohol
}

interconversion "allylic-alcohol-from-enoate" {
    about = "Unsaturated ester reduction with DIBAL; 1,2-reduction, alkene geometry kept",
    target = "[C;X4;H2:1]([C;X3:3]=[C;X3:4])[O;X2;H1:2]",
    from = "[C;X3;H0:1]([C;X3:3]=[C;X3:4])(=[O;X1;H0:2])[O;X2;H0][C;H2][C;H3]",
    conditions = "dibal",
    also_attacks = { "aldehyde", "ketone", "ester", "free acid", "amide", "nitrile", "epoxide", "acyl halide" },
    recipe = "DIBAL-H (2.2 equiv), CH2Cl2 or toluene, -78 °C; also: methyl ester",
    yield = { 80, 95 },
    cautions = { "diisobutylaluminium hydride" },
    source = "Carey and Sundberg, Advanced Organic Chemistry, Part B; from memory",
    example { "OC/C=C/c1ccc(F)cc1", from = { "CCOC(=O)/C=C/c1ccc(F)cc1" } },
    example { "OC/C=C/c1ccccc1", from = { "CCOC(=O)/C=C/c1ccccc1" } },
    refuse { "OCCCc1ccc(F)cc1" }, -- no C=C next to the carbinol carbon
}

interconversion "meerwein-ponndorf-verley" {
    about = "Meerwein-Ponndorf-Verley reduction of a ketone; reversible; halide, nitro and C=C survive; " ..
        "acetone must be distilled off",
    rxno = "RXNO:0000623",
    target = "[C;X4;H1:1]([c:3])([C;X4:4])[O;X2;H1:2]",
    from = "[C;X3;H0:1]([c:3])([C;X4:4])=[O;X1;H0:2]",
    conditions = "alkoxide",
    also_attacks = { "aldehyde", "ketone" },
    recipe = "Al(OiPr)3, iPrOH, reflux, distil acetone",
    yield = { 70, 95 },
    source = "March's Advanced Organic Chemistry; from memory",
    example { "OC(CCl)c1ccc(cc1)[N+](=O)[O-]", from = { "O=C(CCl)c1ccc(cc1)[N+](=O)[O-]" } },
    example { "CC(O)c1ccccc1", from = { "CC(=O)c1ccccc1" } },
    refuse { "OC(c1ccccc1)(C)C" }, -- tertiary alcohol has no H on the carbinol carbon
}

interconversion "cbs-reduction" {
    about = "Enantioselective reduction (Corey-Bakshi-Shibata); enantioselective: large (aryl) and small " ..
        "(alkyl) groups told apart",
    rxno = "RXNO:0000597",
    target = "[C;X4;H1:1]([c:3])([C;X4:4])[O;X2;H1:2]",
    from = "[C;X3;H0:1]([c:3])([C;X4:4])=[O;X1;H0:2]",
    when = function(m) return is_marked_carbinol(m) end,
    conditions = "borane",
    also_attacks = { "alkene", "aldehyde", "ketone", "free acid", "imine", "nitrile" },
    recipe = "(S)- or (R)-2-methyl-CBS-oxazaborolidine (cat), BH3·THF, THF, 0 °C",
    yield = { 80, 97 },
    cautions = { "borane-tetrahydrofuran complex" },
    source = "E. J. Corey, R. K. Bakshi and S. Shibata, J. Am. Chem. Soc. 1987, 109, 5551; from memory",
    example { "O[C@@H](CCCl)c1ccccc1", from = { "O=C(CCCl)c1ccccc1" } },
    example { "C[C@@H](O)c1ccccc1", from = { "CC(=O)c1ccccc1" } },
    refuse { "OC(CCCl)(C)c1ccccc1" }, -- tertiary alcohol has no H on the carbinol carbon
    refuse { "CC(O)c1ccccc1" }, -- racemic: a plain hydride
}

interconversion "epoxide-opening-by-hydride" {
    about = "Epoxide opening by hydride; hydride to the less substituted carbon, configuration of C-O kept",
    target = "[C;X4;H1:1]([#6;!$([#6]=[O,N]);!$(C#N):3])([O;X2;H1:2])[C;X4;H3:4]",
    from = "[C;X4;H1:1]1([#6:3])[O;X2;H0:2][C;X4;H2:4]1",
    conditions = "lialh4",
    also_attacks = { "aldehyde", "ketone", "ester", "free acid", "amide", "nitrile", "epoxide", "acyl halide",
        "alkyl halide", "nitro", "azide" },
    recipe = "LiAlH4, THF or Et2O, 0 °C to rt; also: LiEt3BH",
    yield = { 80, 95 },
    cautions = { "lithium aluminium hydride" },
    source = "March's Advanced Organic Chemistry; from memory",
    example { "CC(O)Cc1ccc(OC)cc1", from = { "COc1ccc(cc1)CC1CO1" } },
    example { "CCCCCCC(C)O", from = { "CCCCCCC1CO1" } },
    refuse { "OCCCc1ccccc1" }, -- hydride opens at the terminal carbon, so the primary alcohol is not formed
    refuse { "CC(O)C(=O)OC" }, -- a glycidic ester is reduced too
}

interconversion "nucleophilic-epoxidation" {
    about = "Nucleophilic epoxidation of an enone (Weitz-Scheffer); enone only, not stereospecific (trans " ..
        "epoxide); plain alkenes survive",
    target = "[#6:5][C;X3:4](=[O;X1:6])[C;X4;r3:1]1[O;X2;r3][C;X4;r3:3]1",
    from = "[#6:5][C;X3:4](=[O;X1:6])[C;X3:1]=[C;X3:3]",
    conditions = "h2o2-base",
    also_attacks = { "aldehyde", "acyl halide", "nitrile", "ester" },
    recipe = "H2O2, NaOH, MeOH, 0-20 °C; also: tBuOOH, base",
    yield = { 70, 90 },
    cautions = { "hydrogen peroxide", "sodium hydroxide" },
    source = "Org. Synth. Coll. Vol. 4 (isophorone oxide); from memory",
    example { "CC1(C)CC(=O)C2OC2(C)C1", from = { "CC1(C)CC(=O)C=C(C)C1" } },
    example { "O=C1CCCC2OC12", from = { "O=C1CCCC=C1" } },
    refuse { "C1CCC2OC2C1" }, -- no carbonyl conjugated with the alkene
}

interconversion "selenium-dioxide-allylic-oxidation" {
    about = "Allylic oxidation with selenium dioxide (Riley); E-methyl of a trisubstituted alkene " ..
        "(Guillemonat rules), E alcohol",
    target = "[O;X2;H1][C;X4;H2:1]/[C;X3;H0:3]([C;X4;H3:6])=[C;X3;H1:4]/[C;X4:5]",
    from = "[C;X4;H3:1][C;X3;H0:3]([C;X4;H3:6])=[C;X3;H1:4][C;X4:5]",
    also_attacks = { "alkene", "ketone", "aldehyde", "thiol" },
    recipe = "SeO2 (cat), tBuOOH, CH2Cl2, rt",
    yield = { 45, 70 },
    cautions = { "selenium dioxide", "tert-butyl hydroperoxide" },
    source = "M. A. Umbreit and K. B. Sharpless, J. Am. Chem. Soc. 1977, 99, 5526; from memory",
    example { "CC(=O)OC/C=C(\\C)CC/C=C(\\C)CO", from = { "CC(=O)OC/C=C(\\C)CCC=C(C)C" } },
    refuse { "CC(=O)OC/C=C(\\C)CC/C=C(/C)CO" }, -- Z allylic alcohol is not formed
}

interconversion "sharpless-epoxidation" {
    about = "Sharpless asymmetric epoxidation; enantioselective (L- or D-tartrate chooses the face), trans " ..
        "epoxide from E alkene",
    rxno = "RXNO:0000141",
    target = "[O;X2;H1:5][C;X4;H2:4][C;X4;H1;r3:1]1[O;X2;r3][C;X4;r3;H1:3]1[#6:6]",
    from = "[O;X2;H1:5][C;X4;H2:4]/[C;X3;H1:1]=[C;X3;H1:3]/[#6:6]",
    when = function(m) return is_trans_epoxide(m) end,
    also_attacks = { "thioether", "thiol", "primary amine", "secondary amine", "tertiary amine" },
    recipe = "Ti(OiPr)4, L-(+)-diethyl tartrate, tBuOOH, CH2Cl2, 4 Å sieves, -20 °C",
    yield = { 65, 85 },
    cautions = { "tert-butyl hydroperoxide" },
    source = "T. Katsuki and K. B. Sharpless, J. Am. Chem. Soc. 1980, 102, 5974; from memory",
    example { "CCC[C@@H]1O[C@H]1CO", from = { "CCC/C=C/CO" } },
    example { "OC[C@H]1O[C@@H]1c1ccccc1", from = { "OC/C=C/c1ccccc1" } },
    refuse { "CCCC1OC1CCO" }, -- homoallylic alcohol: the titanium tartrate directs allylic alcohols only
    refuse { "CCC[C@H]1O[C@H]1CO" }, -- the cis epoxide needs the Z alcohol
}

interconversion "sharpless-dihydroxylation" {
    about = "Sharpless asymmetric dihydroxylation; syn addition, enantioselective (AD-mix-α or β chooses " ..
        "the face)",
    rxno = "RXNO:0000142",
    target = "[C;X4;H1:1]([c:5])([O;X2;H1])[C;X4;H1:3]([#6:6])[O;X2;H1]",
    from = "[c:5]/[C;X3;H1:1]=[C;X3;H1:3]/[#6:6]",
    when = function(m) return is_syn_diol(m) end,
    conditions = "oso4",
    also_attacks = { "alkene", "thiol", "thioether" },
    recipe = "AD-mix-β, MeSO2NH2, tBuOH-H2O, 0 °C",
    yield = { 70, 95 },
    cautions = { "potassium osmate" },
    source = "H. C. Kolb, M. S. VanNieuwenhze and K. B. Sharpless, Chem. Rev. 1994, 94, 2483; from memory",
    example { "COC(=O)[C@@H](O)[C@H](O)c1ccccc1", from = { "COC(=O)/C=C/c1ccccc1" } },
    refuse { "COC(=O)[C@H](O)[C@H](O)c1ccccc1" }, -- anti diol from an E alkene is not formed by syn addition
}

interconversion "mitsunobu-inversion" {
    about = "Mitsunobu inversion of an alcohol; inversion",
    rxno = "RXNO:0000034",
    target = "[C@;X4;H1:1]([C:3])([C:4])[O;X2;H1]",
    from = "[C@@;X4;H1:1]([C:3])([C:4])[O;H1]",
    conditions = "mitsunobu",
    also_attacks = { "free acid", "phenol", "thiol", "free alcohol", "sulfonamide" },
    recipe = "4-nitrobenzoic acid, PPh3, DIAD, THF, 0 °C, then K2CO3, MeOH; also: DEAD",
    yield = { 60, 85 },
    cautions = { "diisopropyl azodicarboxylate", "triphenylphosphine" },
    source = "O. Mitsunobu, Synthesis 1981, 1; from memory",
    example { "CC(C)[C@@H]1CC[C@@H](C)C[C@@H]1O", from = { "CC(C)[C@@H]1CC[C@@H](C)C[C@H]1O" } },
    example { "CCCCCC[C@H](C)O", from = { "CCCCCC[C@@H](C)O" } },
    refuse { "CCC[C@](C)(O)CC" }, -- tertiary alcohol does not take part in SN2
}

interconversion "rubottom-oxidation" {
    about = "Rubottom oxidation; alpha position of the silyl enol ether that is formed",
    rxno = "RXNO:0000669",
    target = "[O;X1:2]=[C;X3:1]([#6;$(c),$([CX4;H0]),$([CX4;R]),$(C=C):5])[C;X4;H1:3]([#6;!$(C[OX2H]);!$(C=O):6])[O;X2;H1]",
    from = "[O;X1:2]=[C;X3:1]([#6:5])[C;X4;H2:3][#6:6]",
    conditions = "mcpba",
    also_attacks = { "alkene", "primary amine", "secondary amine", "tertiary amine", "thioether", "aldehyde" },
    recipe = "TMSCl or TBSOTf, Et3N, then mCPBA, CH2Cl2, then fluoride or acid",
    yield = { 60, 85 },
    cautions = { "3-chloroperbenzoic acid", "chlorotrimethylsilane" },
    source = "Kürti and Czakó, Strategic Applications of Named Reactions in Organic Synthesis; from memory",
    example { "O=C1CCc2cc(OC)ccc2C1O", from = { "O=C1CCc2cc(OC)ccc2C1" } },
    example { "OC1CCCCC1=O", from = { "O=C1CCCCC1" } },
    refuse { "O=C1CCCCC1CO" }, -- OH is beta, not alpha, to the carbonyl
    refuse { "CCC(=O)C(C)O" }, -- two methylene groups compete
}
