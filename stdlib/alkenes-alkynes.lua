-- Alkenes and alkynes, and the loss of functional groups.
-- Yields are typical ranges and sources stand from memory unless a source says otherwise.

pack {
    name = "alkenes-alkynes",
    version = "0.1.0",
    licence = "CC0-1.0",
    about = "Alkenes and alkynes, and the loss of functional groups",
    needs = { "synthons" },
}

interconversion "lindlar-reduction" {
    about = "Lindlar hydrogenation of an alkyne; Z (syn addition of H2); alkane is the rival",
    target = "[#6:3]/[C;X3;H1:1]=;!@[C;X3;H1:2]\\[#6:4]",
    from = "[#6:3][C;X2;H0:1]#[C;X2;H0:2][#6:4]",
    conditions = "h2-lindlar",
    also_attacks = { "alkyne", "azide", "nitro", "thiol", "thioether" },
    recipe = "H2 (1 atm), Pd/CaCO3-Pb(OAc)2, quinoline, EtOAc or MeOH, rt; also: P-2 nickel",
    yield = { 80, 96 },
    cautions = { "hydrogen", "lead salts" },
    source = "Clayden, Greeves, Warren, Organic Chemistry; from memory",
    example { "COC(=O)CC/C=C\\CCO", from = { "COC(=O)CCC#CCCO" } },
    example { "CC/C=C\\CC", from = { "CCC#CCC" } },
    refuse { "CC/C=C/CCO" }, -- E alkene is not formed by syn hydrogenation
}

interconversion "dissolving-metal-alkyne" {
    about = "Dissolving-metal reduction of an alkyne; E (anti)",
    target = "[C;X4:3]/[C;X3;H1:1]=;!@[C;X3;H1:2]/[C;X4:4]",
    from = "[C;X4:3][C;X2;H0:1]#[C;X2;H0:2][C;X4:4]",
    conditions = "birch",
    also_attacks = { "alkyne", "alkyl halide", "aryl halide", "benzyl ether", "aldehyde", "ketone", "ester",
        "epoxide", "nitro", "azide", "Cbz amine", "thioether" },
    recipe = "Na, NH3 (l), tBuOH, -78 to -33 °C; also: Li, EtNH2",
    yield = { 75, 92 },
    cautions = { "sodium", "ammonia" },
    source = "Clayden, Greeves, Warren, Organic Chemistry; from memory",
    example { "CCCC/C=C/CCCO", from = { "CCCCC#CCCCO" } },
    example { "CC/C=C/CC", from = { "CCC#CCC" } },
    refuse { "CC/C=C\\CCO" }, -- Z alkene comes from Lindlar hydrogenation
}

interconversion "alkene-hydrogenation" {
    about = "Catalytic hydrogenation (alkene reduction to alkane); syn addition; conjugated and less substituted alkenes first; ester survives",
    rxno = "RXNO:0000339",
    target = "[c:1][C;X4;H2:2][C;X4;H2:3][#6:4]",
    from = "[c:1]/[C;X3;H1:2]=[C;X3;H1:3]/[#6:4]",
    conditions = "h2-pd",
    also_attacks = { "alkene", "alkyne", "nitro", "azide", "imine", "aryl halide", "benzyl ether",
        "benzyl ester", "Cbz amine", "thiol", "thioether" },
    recipe = "H2 (1-3 atm), Pd/C, EtOH or EtOAc, rt; also: PtO2, Raney Ni, (PPh3)3RhCl",
    yield = { 90, 99 },
    cautions = { "hydrogen" },
    source = "Clayden, Greeves, Warren, Organic Chemistry; from memory",
    example { "CCOC(=O)CCc1ccc(O)c(OC)c1", from = { "CCOC(=O)/C=C/c1ccc(O)c(OC)c1" } },
    example { "OC(=O)CCc1ccccc1", from = { "OC(=O)/C=C/c1ccccc1" } },
    refuse { "CC(C)(c1ccccc1)C(C)(C)C" }, -- no H on the two carbons
}

interconversion "dehydration-zaitsev" {
    about = "Acid dehydration of a tertiary alcohol; Zaitsev: the more substituted, conjugated alkene",
    target = "[#6:3][C;X3;H0:1]([C;X4:4])=[C;X3;H1:2][C;X4:5]",
    from = "[#6:3][C;X4;H0:1]([C;X4:4])([O;X2;H1])[C;X4;H2:2][C;X4:5]",
    conditions = "acid-aq-strong",
    also_attacks = { "free alcohol", "acetal", "silyl ether", "tert-butyl ester", "Boc amine", "epoxide",
        "trityl ether" },
    recipe = "TsOH, toluene, Dean-Stark; also: H3PO4; HCl (conc), reflux; SOCl2 or POCl3, pyridine",
    yield = { 70, 92 },
    source = "Clayden, Greeves, Warren, Organic Chemistry; from memory",
    example { "Clc1ccc(cc1)C1=CCNCC1", from = { "OC1(CCNCC1)c1ccc(Cl)cc1" } },
    example { "CC1=CCCCC1", from = { "CC1(O)CCCCC1" } },
    refuse { "C=C1CCCCC1" }, -- the less substituted (exocyclic) alkene is not the Zaitsev product
}

interconversion "e2-terminal-alkene" {
    about = "E2 elimination of a primary halide with a bulky base; terminal alkene; ether is the rival with small alkoxides",
    target = "[C;X4:1][C;X3;H1:2]=[C;X3;H2:3]",
    from = "[C;X4:1][C;X4;H2:2][C;X4;H2:3][Br;X1]",
    conditions = "base-hindered",
    also_attacks = { "alkyl halide", "acyl halide", "ester", "aldehyde", "ketone", "terminal alkyne",
        "free alcohol", "phenol" },
    recipe = "KOtBu, THF or DMSO, 0 °C to rt; also: DBU, heat (I); OTs",
    yield = { 70, 90 },
    cautions = { "potassium tert-butoxide" },
    source = "Clayden, Greeves, Warren, Organic Chemistry; from memory",
    example { "C=CCCCO[Si](C)(C)C(C)(C)C", from = { "BrCCCCCO[Si](C)(C)C(C)(C)C" } },
    example { "C=CCCCC", from = { "BrCCCCCC" } },
    refuse { "CC=CC" }, -- internal alkene is not formed from a primary halide
}

interconversion "e2-zaitsev" {
    about = "E2 elimination of a tertiary halide; Zaitsev; anti-periplanar H and X",
    target = "[C;X3;H0:1]([C;X4:3])([C;X4:4])=[C;X3;H1:2][C;X4:5]",
    from = "[C;X4;H0:1]([C;X4:3])([C;X4:4])([Br;X1])[C;X4;H2:2][C;X4:5]",
    conditions = "alkoxide",
    also_attacks = { "alkyl halide", "acyl halide", "ester", "aldehyde", "ketone", "epoxide" },
    recipe = "NaOEt or KOH, EtOH, reflux; also: DBU; Cl, I",
    yield = { 65, 88 },
    cautions = { "potassium hydroxide" },
    source = "Clayden, Greeves, Warren, Organic Chemistry; from memory",
    example { "CC1=CCCCC1", from = { "CC1(Br)CCCCC1" } },
    example { "CC=C(C)C", from = { "CCC(C)(C)Br" } },
    refuse { "CCC(=C)CC" }, -- bulky base would be needed for the less substituted alkene
}

interconversion "beta-keto-acid-decarboxylation" {
    about = "Hydrolysis and decarboxylation of a beta-keto ester; ketone on the CH2",
    target = "[C;X4;H2,H3;!$(C[#7,#8,#16]):5][C;X4;H2:1][C;X3:2](=[O;X1:3])[#6;$([C;H3]),$(c):4]",
    from = "[C;X4:5][C;X4;H1:1]([C;X3](=O)[O;X2][C;H2][C;H3])[C;X3:2](=[O;X1:3])[#6:4]",
    conditions = "acid-aq-strong",
    also_attacks = { "ester", "acetal", "tert-butyl ester", "Boc amine", "epoxide", "nitrile" },
    recipe = "HCl (aq), reflux; also: NaOH then acid, heat; methyl or tert-butyl (TFA) ester",
    yield = { 75, 95 },
    cautions = { "hydrochloric acid" },
    source = "Clayden, Greeves, Warren, Organic Chemistry; from memory",
    example { "CC(=O)CCc1ccc(Cl)cc1", from = { "CCOC(=O)C(Cc1ccc(Cl)cc1)C(C)=O" } },
    example { "CC(=O)CCCC", from = { "CCOC(=O)C(CCC)C(C)=O" } },
    refuse { "CC(=O)C(C)(C)C" }, -- alpha carbon carries no H to replace the ester group
}

interconversion "krapcho-methyl-malonate" {
    about = "Krapcho decarboxylation; methyl esters; neutral, acetals survive",
    rxno = "RXNO:0000507",
    target = "[C;X4;H2,H3;!$(C[#7,#8,#16]):5][C;X4;H2:1][C;X3:2](=[O;X1:3])[O;X2:4][C;H3:6]",
    from = "[C;X4:5][C;X4;H1:1]([C;X3](=O)[O;X2][C;H3])[C;X3:2](=[O;X1:3])[O;X2:4][C;H3:6]",
    conditions = "heat-200",
    also_attacks = { "alkyl halide", "acyl halide", "epoxide" },
    recipe = "NaCl or LiCl, H2O, DMSO, 150-180 °C",
    yield = { 65, 90 },
    source = "Kürti and Czakó, Strategic Applications of Named Reactions in Organic Synthesis; from memory",
    example { "COC(=O)CCC=C(C)C", from = { "COC(=O)C(CC=C(C)C)C(=O)OC" } },
    example { "COC(=O)CCc1ccccc1", from = { "COC(=O)C(Cc1ccccc1)C(=O)OC" } },
    refuse { "COC(=O)C(C)(C)C" }, -- alpha carbon carries no H to replace the ester group
}

interconversion "dehydration-secondary-ring" {
    about = "Acid dehydration of a cycloalkanol without branches beside the alcohol",
    target = "[CX3;H1;R;r5,r6,r7:1]=;@[CX3;H1;R:2]([CX4;H2:3])",
    from = "[CX4;H1:1]([OX2H])[CX4;H2:2][C:3]",
    when = function(m) return m.atom[1].symmetry == m.atom[2].symmetry end,
    conditions = "acid-aq-strong",
    also_attacks = { "other alcohol", "acetal", "tert-butyl ester" },
    recipe = "conc. H2SO4 or H3PO4, 130-170 °C, the alkene distilled off",
    yield = { 75, 90 },
    cautions = { "sulfuric acid" },
    source = "Coleman, Johnstone, Org. Synth. Coll. Vol. 1, 183; from memory",
    example { "C1=CCCCC1", from = { "OC1CCCCC1" } },
    example { "C1=CCCC1", from = { "OC1CCCC1" } },
    refuse { "CC1=CCCCC1" }, -- gives the trisubstituted alkene from a tertiary alcohol, another rule
}

interconversion "sulfolene-extrusion" {
    about = "Cheletropic extrusion of sulfur dioxide from a 3-sulfolene",
    target = "[CX3;H1,H2;!R:1]=[CX3;!R:2]-[CX3;!R:3]=[CX3;H1,H2;!R:4]",
    from = "[C:1]1[C:2]=[C:3][C:4]S1(=O)=O",
    conditions = "heat-200",
    recipe = "110-140 °C, neat or in xylene; the diene is distilled off or trapped",
    yield = { 80, 95 },
    cautions = { "sulfur dioxide", "buta-1,3-diene" },
    source = "Cope, Herrick, Org. Synth. Coll. Vol. 4, 890, discusses the diene; common practice; from memory",
    example { "C=CC=C", from = { "O=S1(=O)CC=CC1" } },
    example { "CC(=C)C=C", from = { "CC1=CCS(=O)(=O)C1" } },
    refuse { "C1=CC=CCC1" }, -- a cyclic diene would come from a bridged sulfone
}

interconversion "propargylic-alcohol-to-e-alkene" {
    about = "Reduction of a propargylic alcohol with Red-Al; E; hydroxyl directs hydroalumination",
    target = "[O;X2;H1:5][C;X4:6]/[C;X3;H1:1]=;!@[C;X3;H1:2]/[#6:4]",
    from = "[O;X2;H1:5][C;X4:6][C;X2;H0:1]#[C;X2;H0:2][#6:4]",
    conditions = "lialh4",
    also_attacks = { "aldehyde", "ketone", "ester", "free acid", "amide", "nitrile", "epoxide", "acyl halide",
        "alkyl halide", "nitro", "azide" },
    recipe = "NaAlH2(OCH2CH2OMe)2, Et2O or THF, 0 °C; also: LiAlH4, NaOMe, THF",
    yield = { 80, 95 },
    cautions = { "sodium bis(2-methoxyethoxy)aluminium hydride" },
    source = "Carey and Sundberg, Advanced Organic Chemistry, Part B; from memory",
    example { "OC/C=C/CCCOCc1ccccc1", from = { "OCC#CCCCOCc1ccccc1" } },
    example { "OC/C=C/CCC", from = { "OCC#CCCC" } },
    refuse { "OC/C=C\\CCC" }, -- Z allylic alcohol comes from Lindlar hydrogenation
}

interconversion "alkyne-hydrogenation" {
    about = "Catalytic hydrogenation (alkyne reduction to alkane); through the Z alkene",
    rxno = "RXNO:0000350",
    target = "[c:1]-!@[C;X4;H2:2]-!@[C;X4;H2:3][C;X4:4]",
    from = "[c:1][C;X2;H0:2]#[C;X2;H0:3][C;X4:4]",
    conditions = "h2-pd",
    also_attacks = { "alkene", "alkyne", "nitro", "azide", "imine", "aryl halide", "benzyl ether",
        "benzyl ester", "Cbz amine", "thiol", "thioether" },
    recipe = "H2, Pd/C, EtOH, rt; also: PtO2",
    yield = { 90, 99 },
    cautions = { "hydrogen" },
    source = "Clayden, Greeves, Warren, Organic Chemistry; from memory",
    example { "Nc1ccc(CCCCO)cc1", from = { "Nc1ccc(C#CCCO)cc1" } },
    example { "CCCCCCc1ccccc1", from = { "CCCCC#Cc1ccccc1" } },
    refuse { "CC(c1ccccc1)C" }, -- branched carbon beside the arene cannot come from an alkyne
}

interconversion "hofmann-elimination" {
    about = "Hofmann elimination; least substituted alkene",
    rxno = "RXNO:0000166",
    target = "[C;X4;H2;$([C;H2][C;H2][C;H2]):4][C;X3;H1:2]=[C;X3;H2:3]",
    from = "[C;X4;H2:4][C;X4;H1:2]([N;X3]([C;H3])[C;H3])[C;X4;H3:3]",
    conditions = "alkylation",
    also_attacks = { "primary amine", "secondary amine", "tertiary amine", "thiol", "thioether", "phenol",
        "free acid", "ester" },
    recipe = "MeI, then Ag2O, H2O, then 100-200 °C; also: other amines after exhaustive methylation",
    yield = { 60, 85 },
    cautions = { "iodomethane" },
    source = "March's Advanced Organic Chemistry; from memory",
    example { "C=CCCCCc1ccccc1", from = { "CC(CCCCc1ccccc1)N(C)C" } },
    example { "C=CCCCC", from = { "CC(CCCC)N(C)C" } },
    refuse { "CC=CCC" }, -- more substituted (Zaitsev) alkene is not formed
    refuse { "C=CCOc1ccccc1" }, -- an allyl ether comes from allyl bromide
}

interconversion "cope-elimination" {
    about = "Cope elimination; syn elimination, no isomerisation",
    rxno = "RXNO:0000539",
    target = "[C;X3;H0;R:1]([C;X4:3])([C;X4:4])=[C;X3;H2:2]",
    from = "[C;X4;H1:1]([C;X4:3])([C;X4:4])[C;X4;H2:2][N+]([C;H3])([C;H3])[O-]",
    conditions = "heat-200",
    also_attacks = { "thiol", "thioether" },
    recipe = "neat or DMSO-THF, 25-160 °C (N-oxide from the amine and H2O2)",
    yield = { 75, 98 },
    cautions = { "hydrogen peroxide" },
    source = "Org. Synth. Coll. Vol. 4, 612 (methylenecyclohexane); from memory",
    example { "C=C1CCCCC1", from = { "C[N+](C)([O-])CC1CCCCC1" } },
    example { "C=C1CCCCCC1", from = { "C[N+](C)([O-])CC1CCCCCC1" } },
    refuse { "CC1=CCCCC1" }, -- endocyclic isomer: elimination puts the C=C on the exocyclic CH2 and does not isomerise
}

interconversion "chugaev-elimination" {
    about = "Chugaev reaction; syn elimination, no rearrangement",
    rxno = "RXNO:0000538",
    target = "[C;X4;H0:3][C;X3;H1:1]=[C;X3;H2:2]",
    from = "[C;X4;H0:3][C;X4;H1:1]([O;X2][C;X3](=[S;X1])[S;X2][C;H3])[C;X4;H3:2]",
    conditions = "heat-200",
    also_attacks = { "primary amine", "secondary amine", "azide" },
    recipe = "120-200 °C neat (xanthate from the alcohol: NaH, CS2, MeI)",
    yield = { 60, 85 },
    cautions = { "carbon disulfide", "iodomethane", "sodium hydride" },
    source = "Kürti and Czakó, Strategic Applications of Named Reactions in Organic Synthesis; from memory",
    example { "C=CC(C)(C)C", from = { "CSC(=S)OC(C)C(C)(C)C" } },
    refuse { "CC(C)=C(C)C" }, -- rearranged alkene: that is what acid dehydration gives
}

interconversion "grieco-elimination" {
    about = "Terminal alkene from a primary alcohol by selenoxide elimination; syn elimination; acid- and " ..
        "base-sensitive groups survive",
    target = "[C;X4:1][C;X3;H1:2]=[C;X3;H2:3]",
    from = "[C;X4:1][C;X4;H2:2][C;X4;H2:3][O;X2;H1]",
    conditions = "h2o2-base",
    also_attacks = { "free alcohol", "thioether", "tertiary amine", "thiol", "azide" },
    recipe = "2-O2NC6H4SeCN, PBu3, THF, rt, then H2O2",
    yield = { 70, 90 },
    cautions = { "organoselenium compounds", "hydrogen peroxide" },
    source = "P. A. Grieco, S. Gilman and M. Nishizawa, J. Org. Chem. 1976, 41, 1485; from memory",
    example { "C=C[C@@H]1CCC(=O)N1C(=O)OC(C)(C)C", from = { "OCC[C@@H]1CCC(=O)N1C(=O)OC(C)(C)C" } },
    example { "C=CCCCCCC", from = { "OCCCCCCCC" } },
    refuse { "CC=CC" }, -- internal alkene is not formed from a primary alcohol
}

interconversion "alkyne-by-double-elimination" {
    about = "Alkyne by double elimination of a vicinal dibromide; through the vinyl bromide",
    target = "[#6;$(c):1][C;X2:2]#[C;X2:3][#6;!$([C;X4;!H0]):4]",
    from = "[#6:1][C;X4;H1:2]([Br;X1])[C;X4;H1:3]([Br;X1])[#6:4]",
    conditions = "alkoxide",
    also_attacks = { "alkyl halide", "ester", "nitrile", "acyl halide", "epoxide", "aldehyde", "ketone" },
    recipe = "KOH, EtOH or triethylene glycol, heat; also: KOtBu, THF; NaNH2, NH3",
    yield = { 65, 88 },
    cautions = { "potassium hydroxide" },
    source = "Org. Synth. Coll. Vol. 3, 350 (diphenylacetylene); from memory",
    example { "COc1ccc(cc1)C#Cc1ccccc1", from = { "COc1ccc(cc1)C(Br)C(Br)c1ccccc1" } },
    example { "C(#Cc1ccccc1)c1ccccc1", from = { "BrC(c1ccccc1)C(Br)c1ccccc1" } },
    refuse { "CC#CCC" }, -- alkyl side carries H: allene and diene are rivals
}

disconnection "corey-fuchs" {
    about = "Corey-Fuchs reaction; one carbon more",
    rxno = "RXNO:0000146",
    target = "[#6;!$(C#C);!$(C=O);!$([CH2][#7,#8,#16]);!$([CX4][OX2H]):1][C;X2:2]#[C;X2;H1:3]",
    from = "[#6:1][C;X3;H1:2]=[O;X1].[C;X4;H0:3]([Br;X1])([Br;X1])([Br;X1])[Br;X1]",
    conditions = "organolithium",
    also_attacks = { "aldehyde", "ketone", "ester", "alkyl halide", "epoxide", "free alcohol", "free acid",
        "nitrile", "azide", "nitro" },
    recipe = "CBr4, PPh3, CH2Cl2, 0 °C, then nBuLi (2 equiv), THF, -78 °C",
    yield = { 65, 85 },
    cautions = { "butyllithium", "tetrabromomethane", "triphenylphosphine" },
    source = "E. J. Corey and P. L. Fuchs, Tetrahedron Lett. 1972, 3769; from memory",
    example { "C#C[C@@H]1COC(C)(C)O1", from = { "O=C[C@@H]1COC(C)(C)O1", "BrC(Br)(Br)Br" } },
    example { "C#Cc1ccccc1", from = { "O=Cc1ccccc1", "BrC(Br)(Br)Br" } },
    refuse { "CC#CC" }, -- internal alkyne needs an electrophile on the acetylide
    refuse { "C#CCOc1ccccc1" }, -- a propargyl ether comes from propargyl bromide
}

disconnection "bestmann-ohira" {
    about = "Seyferth-Gilbert-Bestmann homologation; one carbon more; alpha centre kept; aldehyde before ketone",
    rxno = "RXNO:0000390",
    target = "[#6;!$(C#C);!$(C=O);!$([CH2][#7,#8,#16]);!$([CX4][OX2H]):1][C;X2:2]#[C;X2;H1:3]",
    from = "[#6:1][C;X3;H1:2]=[O;X1].[C;X3;H0:3](=[N+]=[N-])([C;X3](=O)[C;H3])P(=O)(O[C;H3])O[C;H3]",
    conditions = "base-aq-mild",
    also_attacks = { "aldehyde", "acyl halide", "enone" },
    recipe = "dimethyl (1-diazo-2-oxopropyl)phosphonate, K2CO3, MeOH, rt",
    yield = { 70, 95 },
    cautions = { "diazo compounds" },
    source = "S. Müller, B. Liepold, G. J. Roth and H. J. Bestmann, Synlett 1996, 521; from memory",
    example { "C#Cc1ccc(cc1)C(=O)OC", from = { "COC(=O)c1ccc(C=O)cc1", "CC(=O)C(=[N+]=[N-])P(=O)(OC)OC" } },
    example { "C#CC1CCCCC1", from = { "O=CC1CCCCC1", "CC(=O)C(=[N+]=[N-])P(=O)(OC)OC" } },
    refuse { "CC#CC" }, -- internal alkyne is not formed
    refuse { "C#CCOc1ccccc1" }, -- a propargyl ether comes from propargyl bromide
}

disconnection "alkene-hydrosilylation" {
    about = "Hydrosilylation of a terminal alkene; anti-Markovnikov",
    rxno = "RXNO:0000290",
    target = "[C;X4:1][C;X4;H2:2][C;X4;H2:3][Si;X4;!$([Si][#8]):4]",
    from = "[C;X4:1][C;X3;H1:2]=[C;X3;H2:3].[Si;H1:4]",
    also_attacks = { "alkene", "alkyne", "aldehyde", "ketone", "free alcohol", "thiol" },
    recipe = "H2PtCl6 or Karstedt catalyst, toluene, 60 °C; also: chlorosilanes",
    yield = { 75, 95 },
    source = "March's Advanced Organic Chemistry; from memory",
    example { "CC[Si](CC)(CC)CCCCC(=O)OCC", from = { "C=CCCC(=O)OCC", "CC[SiH](CC)CC" } },
    example { "CCCCCCCC[Si](CC)(CC)CC", from = { "CCCCCCC=C", "CC[SiH](CC)CC" } },
    refuse { "CC(C)[Si](C)(C)C" }, -- Markovnikov isomer is not formed
}

interconversion "barton-mccombie" {
    about = "Barton-McCombie deoxygenation; radical: no elimination of beta C-O, no rearrangement; " ..
        "secondary alcohols",
    rxno = "RXNO:0000134",
    target = "[C;X4;H2;R:1]([C;X4;R;$(C[#8]):2])[C;X4;R;$(C[#8]):3]",
    from = "[C;X4;H1;R:1]([C;X4;R:2])([C;X4;R:3])[O;X2;H1]",
    conditions = "tin-radical",
    also_attacks = { "alkyl halide", "alkene", "azide", "nitro", "thiol", "free alcohol" },
    recipe = "NaH, CS2, MeI (or PhOC(S)Cl), then Bu3SnH, AIBN, toluene, reflux; also: thiocarbonylimidazole; (TMS)3SiH",
    yield = { 65, 90 },
    cautions = { "tributyltin hydride", "carbon disulfide", "sodium hydride", "iodomethane", "AIBN" },
    source = "D. H. R. Barton and S. W. McCombie, J. Chem. Soc., Perkin Trans. 1 1975, 1574; from memory",
    example { "CC1(C)OC[C@@H](O1)[C@H]1O[C@@H]2OC(C)(C)O[C@@H]2C1", from = { "CC1(C)OC[C@@H](O1)[C@H]1O[C@@H]2OC(C)(C)O[C@@H]2C1O" } },
    refuse { "CCc1ccccc1" }, -- no oxygen-bearing ring neighbours (rule kept to sugars and polyols)
}

interconversion "radical-dehalogenation" {
    about = "Radical reduction of an alkyl iodide; halide only; lactone, ester, alcohol survive (an alkene " ..
        "five bonds away would be attacked by the radical)",
    target = "[C;X4;H3:1][C;X4;H1;r5:2][O;X2;r5:3][C;X3;r5:4]=[O;X1:5]",
    from = "[C;X4;H2:1]([I;X1])[C;X4;H1;r5:2][O;X2;r5:3][C;X3;r5:4]=[O;X1:5]",
    conditions = "tin-radical",
    also_attacks = { "alkyl halide", "aryl halide", "azide", "nitro", "thiol" },
    recipe = "Bu3SnH, AIBN, toluene, 80-110 °C; also: (TMS)3SiH; H2, Pd/C, Et3N; Br",
    yield = { 80, 96 },
    cautions = { "tributyltin hydride", "AIBN" },
    source = "Carey and Sundberg, Advanced Organic Chemistry, Part B; from memory",
    example { "CC1CC(Cc2ccc(OC)cc2)C(=O)O1", from = { "ICC1CC(Cc2ccc(OC)cc2)C(=O)O1" } },
    example { "CC1CCC(=O)O1", from = { "ICC1CCC(=O)O1" } },
    refuse { "CC1(C)CCC(=O)O1" }, -- quaternary carbon: the rule asks for a CH beside the methyl group
}

interconversion "tosylate-reduction" {
    about = "Reduction of a tosylate to a methyl group; SN2 by hydride at the primary carbon",
    target = "[C;X4;H3:1]-[C;X4;H1;R;$([C;R]@[C;R]@[N,O;R]),$([C;R]@[N,O;R]):2]",
    from = "[C;X4;H2:1]([O;X2][S;X4](=O)(=O)c1ccc([C;H3])cc1)-[C;X4;H1;R:2]",
    conditions = "lialh4",
    also_attacks = { "aldehyde", "ketone", "ester", "free acid", "amide", "nitrile", "epoxide", "acyl halide",
        "alkyl halide", "nitro", "azide" },
    recipe = "LiEt3BH, THF, 0 °C to rt; also: LiAlH4, Et2O; NaBH4, DMSO, 80 °C; OMs, Br, I",
    yield = { 80, 95 },
    step_cost = 30,
    cautions = { "lithium triethylborohydride" },
    source = "Larock, Comprehensive Organic Transformations; from memory",
    example { "CC1CCN(Cc2ccccc2)C1", from = { "Cc1ccc(cc1)S(=O)(=O)OCC1CCN(Cc2ccccc2)C1" } },
    refuse { "Cc1ccccc1" }, -- methyl on an arene
    refuse { "CC1CCCCC1" }, -- bought, or made otherwise: kept to rings with a heteroatom
}

interconversion "dithiolane-desulfurisation" {
    about = "Raney nickel desulfurisation of a dithiolane; C=O to CH2 under neutral conditions; ester survives",
    target = "[C;X4;H2;r6:1]1[C;X4;H2;r6:2][C;X4;H2;r6:3][C;X4;H1;r6:4][C;X4;H2;r6:5][C;X4;H2;r6:6]1",
    from = "[C;X4;H0:1]12([C;X4;H2:2][C;X4;H2:3][C;X4;H1:4][C;X4;H2:5][C;X4;H2:6]1)[S;X2][C;H2][C;H2][S;X2]2",
    when = function(m) return not m.molecule:has "[$([SX2]),$([#6]=S)]" end,
    conditions = "h2-raney",
    also_attacks = { "thiol", "thioether", "alkene", "alkyne", "nitro", "azide", "aldehyde", "ketone",
        "aryl halide" },
    recipe = "Raney Ni, EtOH, reflux (dithiolane from the ketone, HS(CH2)2SH, BF3·OEt2); also: Bu3SnH, AIBN",
    yield = { 70, 92 },
    cautions = { "nickel (Raney)", "boron trifluoride etherate" },
    source = "Larock, Comprehensive Organic Transformations; from memory",
    example { "COC(=O)C1CCCCC1", from = { "COC(=O)C1CCC2(CC1)SCCS2" } },
    example { "CC1CCCCC1", from = { "CC1CCC2(CC1)SCCS2" } },
    refuse { "CC1(C)CCCCC1" }, -- no CH2 across the ring from a substituted CH (rule kept to 4-substituted cyclohexanones)
}

interconversion "wolff-kishner-ring-ketone" {
    about = "Wolff-Kishner reduction, Huang-Minlon modification; C=O to CH2 in base; acid-sensitive groups " ..
        "survive",
    rxno = "RXNO:0000227",
    target = "[C;X4;H2;r6:2]([C;X4;H2;r6;$(C@[N;X3]):1])[C;X4;H1;x3;r6:3]",
    from = "[C;X3;H0:2](=[O;X1])([C;X4:1])[C;X4;H1:3]",
    conditions = "wolff-kishner",
    also_attacks = { "aldehyde", "ketone", "ester", "alkyl halide", "acyl halide", "nitro", "nitrile",
        "epoxide", "imide" },
    recipe = "N2H4·H2O, KOH, diethylene glycol, 130-200 °C; also: tosylhydrazone, NaBH3CN",
    yield = { 65, 90 },
    cautions = { "hydrazine", "potassium hydroxide" },
    source = "Kürti and Czakó, Strategic Applications of Named Reactions in Organic Synthesis; from memory",
    example { "C1CC2CCN1CC2", from = { "O=C1CN2CCC1CC2" } },
    refuse { "C1CCCCC1" }, -- no bridgehead or ring fusion beside the CH2 (rule kept to fused and bridged ketones)
    refuse { "C1CCC2CCCCC2C1" }, -- kept to amines: the amino ketone comes from a Dieckmann condensation
}

interconversion "silane-reduction-of-diaryl-ketone" {
    about = "Ionic reduction of a diaryl ketone with triethylsilane; benzylic cations only; aryl halide survives",
    target = "[c:1]-!@[C;X4;H2:2]-!@[c:3]",
    from = "[c:1][C;X3;H0:2](=[O;X1])[c:3]",
    conditions = "lewis-acid",
    also_attacks = { "aldehyde", "ketone", "acetal", "silyl ether", "tert-butyl ester", "Boc amine",
        "tertiary alcohol", "epoxide" },
    recipe = "Et3SiH, BF3·OEt2 or CF3CO2H, CH2Cl2-MeCN, 0-50 °C; also: NaBH4, AlCl3; the benzhydrol",
    yield = { 75, 95 },
    cautions = { "boron trifluoride etherate", "trifluoroacetic acid" },
    source = "Larock, Comprehensive Organic Transformations; from memory",
    example { "CCOc1ccc(Cc2cc(Br)ccc2Cl)cc1", from = { "CCOc1ccc(cc1)C(=O)c1cc(Br)ccc1Cl" } },
    example { "c1ccc(cc1)Cc1ccccc1", from = { "O=C(c1ccccc1)c1ccccc1" } },
    refuse { "C(c1ccccc1)(c1ccccc1)c1ccccc1" }, -- triarylmethane: carbon is not CH2
}

interconversion "shapiro-reaction" {
    about = "Shapiro reaction; less substituted alkene; carbon of C=N becomes CH",
    rxno = "RXNO:0000125",
    target = "[C;X4;H0;R:3][C;X3;H1;R:1]=[C;X3;H1;R:2][C;X4;R:4]",
    from = "[C;X4;H0;R:3][C;X3;H0;R:1](=[N;X2][N;X3;H1][S;X4](=O)(=O)c1ccc([C;H3])cc1)[C;X4;H2;R:2][C;X4;R:4]",
    conditions = "organolithium",
    also_attacks = { "aldehyde", "ketone", "ester", "nitrile", "alkyl halide", "epoxide", "free alcohol",
        "free acid", "nitro", "terminal alkyne", "aryl halide" },
    recipe = "MeLi or nBuLi (2-4 equiv), Et2O or hexane-TMEDA, 0 °C",
    yield = { 65, 95 },
    cautions = { "methyllithium", "butyllithium" },
    source = "Org. Synth. Coll. Vol. 6 (2-bornene); from memory",
    example { "CC1(C)[C@@H]2CC[C@@]1(C)C=C2", from = { "CC1(C)[C@@H]2CC[C@@]1(C)C(=NNS(=O)(=O)c1ccc(C)cc1)C2" } },
    refuse { "CC1=CCCCC1" }, -- more substituted alkene: the kinetic base takes the CH2
}
