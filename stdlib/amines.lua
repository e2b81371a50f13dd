-- Amines and other nitrogen compounds.
-- Yields are typical ranges and sources stand from memory unless a source says otherwise.

pack {
    name = "amines",
    version = "0.1.0",
    licence = "CC0-1.0",
    about = "Amines and other nitrogen compounds",
    needs = { "synthons" },
}

disconnection "reductive-amination-primary" {
    about = "Reductive amination with ammonia; primary amine with excess ammonia; secondary amine is the rival",
    rxno = "RXNO:0000335",
    target = "[#6;!$(C=[O,N]);!$(C#N):1][C;X4;H1:2]([#6;!$(C=[O,N]);!$(C#N):3])[N;X3;H2:4]",
    cut = { 2, 4 },
    acceptor = { 2, "alkylidene" },
    donor = { 4, "amine" },
    conditions = "reductive-amination",
    also_attacks = { "aldehyde", "ketone", "acyl halide", "imine" },
    recipe = "NH4OAc (10 equiv), NaBH3CN, MeOH, rt; also: NH3, H2, Raney Ni",
    yield = { 60, 85 },
    cautions = { "sodium cyanoborohydride" },
    source = "Warren and Wyatt, Organic Synthesis: The Disconnection Approach; from memory",
    example { "CC(N)c1ccc(cc1)C(F)(F)F", from = { "CC(=O)c1ccc(cc1)C(F)(F)F", "N" } },
    refuse { "CC(C)(C)N" }, -- tertiary alkylamine: no H on the amine carbon
}

disconnection "reductive-amination-secondary" {
    about = "Reductive amination of an aldehyde with a primary amine; stops at the secondary amine if the imine forms first",
    rxno = "RXNO:0000335",
    target = "[#6;!$(C=[O,N]);!$(C#N):4][C;X4;H2:1]-!@[N;X3;H1:2]-!@[#6;!$(C=[O,N,S]):3]",
    cut = { 1, 2 },
    acceptor = { 1, "alkylidene" },
    donor = { 2, "amine" },
    conditions = "reductive-amination",
    also_attacks = { "aldehyde", "ketone", "acyl halide", "imine" },
    recipe = "NaBH(OAc)3, ClCH2CH2Cl, rt; also: NaBH4, MeOH after imine formation",
    yield = { 75, 95 },
    cautions = { "sodium triacetoxyborohydride" },
    source = "A. F. Abdel-Magid et al., J. Org. Chem. 1996, 61, 3849; from memory",
    example { "COC(=O)[C@H](Cc1ccccc1)NCc1ccco1", from = { "O=Cc1ccco1", "COC(=O)[C@@H](N)Cc1ccccc1" } },
    refuse { "CC(C)(C)NC(C)(C)C" }, -- no CH2 on nitrogen
}

disconnection "reductive-amination-ketone" {
    about = "Reductive amination of a ketone with an amine; equatorial or axial mixture in rings; slower than aldehydes",
    rxno = "RXNO:0000335",
    target = "[#6;!$(C=[O,N]);!$(C#N):4][C;X4;H1:1]([C;X4:6])-!@[N;X3;!$(N[C,S]=[O,S,N]);!$(N[#7,#8,#16]);!H2:2]",
    cut = { 1, 2 },
    acceptor = { 1, "alkylidene" },
    donor = { 2, "amine" },
    conditions = "reductive-amination",
    also_attacks = { "aldehyde", "ketone", "acyl halide", "imine" },
    recipe = "NaBH(OAc)3, AcOH, ClCH2CH2Cl, rt; also: NaBH3CN, MeOH, pH 6",
    yield = { 65, 92 },
    cautions = { "sodium triacetoxyborohydride" },
    source = "A. F. Abdel-Magid et al., J. Org. Chem. 1996, 61, 3849; from memory",
    example { "CC(C)(C)OC(=O)N1CCC(CC1)Nc1ccccc1", from = { "O=C1CCN(CC1)C(=O)OC(C)(C)C", "Nc1ccccc1" } },
    refuse { "CC(C)NC(C)=O" }, -- amide nitrogen
}

disconnection "reductive-amination-tertiary" {
    about = "Reductive amination of an aldehyde with a secondary amine; through the iminium ion",
    rxno = "RXNO:0000335",
    target = "[#6;!$(C=[O,N]);!$(C#N):4][C;X4;H2:1]-!@[N;X3;H0;!$(N[C,S]=[O,S,N]);!$(N[#7,#8,#16]):2]([C;X4:3])[C;X4:5]",
    cut = { 1, 2 },
    acceptor = { 1, "alkylidene" },
    donor = { 2, "amine" },
    conditions = "reductive-amination",
    also_attacks = { "aldehyde", "ketone", "acyl halide", "imine", "primary amine" },
    recipe = "NaBH(OAc)3, ClCH2CH2Cl, rt",
    yield = { 80, 96 },
    cautions = { "sodium triacetoxyborohydride" },
    source = "A. F. Abdel-Magid et al., J. Org. Chem. 1996, 61, 3849; from memory",
    example { "CN1CCN(CC1)Cc1ccc(cc1)C(=O)OC", from = { "COC(=O)c1ccc(C=O)cc1", "CN1CCNCC1" } },
    refuse { "CC(=O)N(C)Cc1ccccc1" }, -- amide nitrogen
}

disconnection "eschweiler-clarke" {
    about = "Eschweiler-Clarke methylation; methyl only; no quaternary salt",
    rxno = "RXNO:0000376",
    target = "[C;X4:1][N;X3;H0;!$(N[C,S]=[O,S,N]);!$(N[#7,#8,#16]):2]([C;X4:3])-!@[C;X4;H3:4]",
    cut = { 4, 2 },
    acceptor = { 4, "alkylidene" },
    donor = { 2, "amine" },
    conditions = "reductive-amination",
    also_attacks = { "acetal", "tert-butyl ester", "Boc amine", "thiol", "phenol", "electron-rich arene" },
    recipe = "HCHO (aq), HCO2H, 80-100 °C; also: HCHO, NaBH(OAc)3",
    yield = { 75, 95 },
    cautions = { "formaldehyde", "formic acid" },
    source = "Kürti and Czakó, Strategic Applications of Named Reactions in Organic Synthesis; from memory",
    example { "CN1CCC(CC1)C(c1ccccc1)c1ccccc1", from = { "C1CNCCC1C(c1ccccc1)c1ccccc1", "C=O" } },
    refuse { "CN(C(C)=O)C" }, -- amide nitrogen
}

interconversion "imine-reduction" {
    about = "Imine reduction to amine; racemic; hydride from the less hindered face",
    rxno = "RXNO:0000343",
    target = "[#6:1][C;X4;H1:2]([#6:5])-[N;X3;H1;!$(N[C,S]=[O,S,N]);!$(N[#7,#8,#16]):3][#6:4]",
    from = "[#6:1][C;X3;H0:2]([#6:5])=[N;X2;H0:3][#6:4]",
    conditions = "nabh4",
    also_attacks = { "aldehyde", "ketone", "acyl halide", "imine" },
    recipe = "NaBH4, MeOH, 0 °C; also: H2, Pd/C; asymmetric transfer hydrogenation (Ru-TsDPEN)",
    yield = { 80, 97 },
    cautions = { "sodium borohydride" },
    source = "Carey and Sundberg, Advanced Organic Chemistry, Part B; from memory",
    example { "COc1cc2CCNC(C)c2cc1OC", from = { "COc1cc2CCN=C(C)c2cc1OC" } },
    refuse { "CC(C)(C)NC" }, -- carbon on one side carries no H, the other is a methyl group
}

disconnection "amine-alkylation" {
    about = "Alkylation of a secondary amine by an alkyl halide; over-alkylation to the quaternary salt is the rival; primary amines give mixtures",
    target = "[N;X3;H0;!$(N[C,S]=[O,S,N]);!$(N[#7,#8,#16]):1]([C;X4:3])([C;X4:4])-!@[C;X4;H2:2][#6;!$([C;X4;H0]):5]",
    cut = { 2, 1 },
    acceptor = { 2, "alkyl" },
    donor = { 1, "amine" },
    conditions = "alkylation",
    also_attacks = { "alkyl halide", "acyl halide", "epoxide", "primary amine", "thiol", "phenol",
        "free acid", "enone" },
    recipe = "K2CO3 or iPr2NEt, MeCN or DMF, 60-80 °C, KI (cat); also: Cl with KI, I, OMs, OTs",
    yield = { 60, 88 },
    cautions = { "N,N-dimethylformamide" },
    source = "Warren and Wyatt, Organic Synthesis: The Disconnection Approach; from memory",
    example { "O=C(CCCN1CCC(O)(CC1)c1ccc(Cl)cc1)c1ccc(F)cc1", from = { "OC1(CCNCC1)c1ccc(Cl)cc1", "BrCCCC(=O)c1ccc(F)cc1" } },
    refuse { "CN(C)C(C)(C)C" }, -- tertiary halide eliminates
}

disconnection "phthalimide-alkylation" {
    about = "Alkylation of phthalimide (Gabriel synthesis, first step); SN2; secondary halides eliminate in part",
    rxno = "RXNO:0000103",
    target = "[O;X1:6]=[C;X3:1]1[c:7][c:8][C;X3:3](=[O;X1:9])[N;X3:2]1-!@[C;X4;H2:4][#6;!$([C;X4;H0]):5]",
    cut = { 4, 2 },
    acceptor = { 4, "alkyl" },
    donor = { 2, "amide-nitrogen" },
    conditions = "alkylation",
    also_attacks = { "alkyl halide", "acyl halide", "epoxide", "primary amine" },
    recipe = "potassium phthalimide, DMF, 60-90 °C; also: I, Cl, OTs, OMs; Mitsunobu from the alcohol",
    yield = { 75, 95 },
    cautions = { "N,N-dimethylformamide" },
    source = "Kürti and Czakó, Strategic Applications of Named Reactions in Organic Synthesis; from memory",
    example { "O=C1c2ccccc2C(=O)N1CCCC#N", from = { "O=C1NC(=O)c2ccccc12", "BrCCCC#N" } },
    refuse { "O=C1c2ccccc2C(=O)N1C(C)(C)C" }, -- tertiary halide eliminates
}

interconversion "gabriel-amine" {
    about = "Gabriel synthesis (Ing-Manske procedure, release of the amine); primary amines only",
    rxno = "RXNO:0000104",
    target = "[C;X4;H2:1]([#6:3])[N;X3;H2:2]",
    from = "[C;X4;H2:1]([#6:3])[N;X3;H0:2]1C(=O)c2ccccc2C1=O",
    conditions = "hydrazine",
    also_attacks = { "ester", "aldehyde", "ketone", "acyl halide", "imide", "anhydride", "alkyl halide" },
    recipe = "N2H4·H2O, EtOH, reflux; also: MeNH2; ethanolamine",
    yield = { 75, 95 },
    cautions = { "hydrazine" },
    source = "Kürti and Czakó, Strategic Applications of Named Reactions in Organic Synthesis; from memory",
    example { "NCCCOc1ccc(Cl)cc1", from = { "O=C1c2ccccc2C(=O)N1CCCOc1ccc(Cl)cc1" } },
    refuse { "CNCc1ccccc1" }, -- secondary amine is not formed
}

interconversion "azide-reduction" {
    about = "Staudinger reduction of an azide; configuration kept",
    target = "[#6;!$(C=[O,N,S]):1][N;X3;H2:2]",
    from = "[#6:1][N;X2;H0:2]=[N+]=[N-]",
    conditions = "phosphine",
    also_attacks = { "azide", "aldehyde", "acyl halide" },
    recipe = "PPh3, THF-H2O, rt to 50 °C; also: H2, Pd/C; Zn, NH4Cl",
    yield = { 80, 97 },
    cautions = { "organic azides", "triphenylphosphine" },
    source = "March's Advanced Organic Chemistry; from memory",
    example { "COC(=O)[C@@H]1C[C@H](N)CN1C(=O)OC(C)(C)C", from = { "COC(=O)[C@@H]1C[C@H](N=[N+]=[N-])CN1C(=O)OC(C)(C)C" } },
    refuse { "CNC" }, -- secondary amine is not formed
}

interconversion "nitrile-reduction" {
    about = "Nitrile reduction to amine; secondary amine is the rival in hydrogenation (add NH3)",
    rxno = "RXNO:0000342",
    target = "[#6:1][C;X4;H2:2][N;X3;H2:3]",
    from = "[#6:1][C;X2;H0:2]#[N;X1;H0:3]",
    conditions = "lialh4",
    also_attacks = { "aldehyde", "ketone", "ester", "free acid", "amide", "nitrile", "epoxide", "acyl halide",
        "alkyl halide", "nitro", "azide" },
    recipe = "LiAlH4, Et2O or THF, reflux; also: H2, Raney Ni, NH3; BH3·THF",
    yield = { 70, 92 },
    cautions = { "lithium aluminium hydride" },
    source = "Clayden, Greeves, Warren, Organic Chemistry; from memory",
    example { "NCCc1c[nH]c2ccc(OC)cc12", from = { "N#CCc1c[nH]c2ccc(OC)cc12" } },
    refuse { "CC(N)c1ccccc1" }, -- amine on a CH needs an organometallic as well
}

interconversion "nitro-reduction" {
    about = "Nitro reduction to amine; ester and aryl chloride survive with Fe, Zn or SnCl2",
    rxno = "RXNO:0000337",
    target = "[c:1][N;X3;H2;+0:2]",
    from = "[c:1][N;X3;H0;+:2](=[O;X1])[O;X1;-]",
    conditions = "fe-acid",
    also_attacks = { "nitro", "azide", "imine", "aldehyde" },
    recipe = "Fe, NH4Cl, EtOH-H2O, 70 °C; also: H2, Pd/C (no halide, alkene, benzyl group); SnCl2; Na2S2O4",
    yield = { 80, 97 },
    cautions = { "iron powder" },
    source = "Clayden, Greeves, Warren, Organic Chemistry; from memory",
    example { "COC(=O)c1ccc(N)c(Cl)c1", from = { "COC(=O)c1ccc([N+](=O)[O-])c(Cl)c1" } },
    refuse { "NCc1ccccc1" }, -- amine not on the arene
}

interconversion "amide-reduction" {
    about = "Amide reduction to amine; C=O becomes CH2 (whole alkyl group on N)",
    rxno = "RXNO:0000338",
    target = "[#6;!$(C=[O,N]):1][C;X4;H2:2]-[N;X3;!$(N[C,S]=[O,S,N]);!$(N[#7,#8,#16]):3]",
    from = "[#6:1][C;X3;H0:2](=[O;X1])[N;X3:3]",
    conditions = "lialh4",
    also_attacks = { "aldehyde", "ketone", "ester", "free acid", "amide", "nitrile", "epoxide", "acyl halide",
        "alkyl halide", "nitro", "azide" },
    recipe = "LiAlH4, THF, reflux; also: BH3·THF (spares ester, nitro)",
    yield = { 75, 95 },
    cautions = { "lithium aluminium hydride" },
    source = "Clayden, Greeves, Warren, Organic Chemistry; from memory",
    example { "CCN1CCCc2cc(OC)ccc12", from = { "CC(=O)N1CCCc2cc(OC)ccc12" } },
    refuse { "CN(C)C(=O)CC" }, -- still an amide
}

interconversion "oxime-reduction" {
    about = "Oxime reduction to a primary amine; axial or equatorial mixture in rings",
    target = "[#6;!$(C=[O,N]);!$(C#N):1][C;X4;H1:2]([#6;!$(C=[O,N]);!$(C#N):3])[N;X3;H2:4]",
    from = "[#6:1][C;X3;H0:2]([#6:3])=[N;X2;H0:4][O;X2;H1]",
    conditions = "h2-raney",
    also_attacks = { "aldehyde", "ketone", "ester", "free acid", "amide", "nitrile", "epoxide", "acyl halide",
        "alkyl halide", "nitro", "azide" },
    recipe = "LiAlH4, THF, reflux; also: H2, Raney Ni; Zn, AcOH; Na, EtOH",
    yield = { 70, 92 },
    cautions = { "lithium aluminium hydride" },
    source = "Larock, Comprehensive Organic Transformations; from memory",
    example { "NC1CCc2cc(OC)ccc12", from = { "ON=C1CCc2cc(OC)ccc12" } },
    refuse { "CC(C)(C)N" }, -- no H on the amine carbon
}

disconnection "azole-n-alkylation" {
    about = "Heteroaryl N-alkylation; less hindered N; regioisomers in unsymmetrical pyrazoles, imidazoles, triazoles, indazoles",
    rxno = "RXNO:0000345",
    target = "[n;X3;+0;r5:1]-!@[C;X4;H3,$([C;H2][#6;!$([C;X4;H0])]):2]",
    cut = { 2, 1 },
    acceptor = { 2, "alkyl" },
    donor = { 1, "azole" },
    conditions = "alkylation",
    also_attacks = { "alkyl halide", "acyl halide", "phenol", "thiol", "free acid", "epoxide" },
    recipe = "NaH or K2CO3 or Cs2CO3, DMF, 0 °C to rt; also: I, Cl, OMs, OTs",
    yield = { 65, 92 },
    cautions = { "sodium hydride", "N,N-dimethylformamide" },
    source = "Larock, Comprehensive Organic Transformations; from memory",
    example { "COC(=O)Cn1cc(C=O)c2ccccc12", from = { "O=Cc1c[nH]c2ccccc12", "COC(=O)CBr" } },
    refuse { "CC(C)(C)n1ccnc1" }, -- tertiary halide eliminates
}

disconnection "sulfonamide-n-alkylation" {
    about = "N-Alkylation of a sulfonamide; monoalkylation where one N-H is left",
    target = "[S;X4:1](=[O;X1:5])(=[O;X1:6])-[N;X3;H0:2]([#6:3])-!@[C;X4;H3,$([C;H2][#6;!$([C;X4;H0])]):4]",
    cut = { 4, 2 },
    acceptor = { 4, "alkyl" },
    donor = { 2, "sulfonamide-nitrogen" },
    conditions = "alkylation",
    also_attacks = { "alkyl halide", "acyl halide", "phenol", "thiol", "free acid", "primary amine" },
    recipe = "K2CO3 or Cs2CO3, DMF or MeCN, rt to 60 °C; also: I, OTs; alcohol, PPh3, DIAD",
    yield = { 75, 95 },
    cautions = { "N,N-dimethylformamide" },
    source = "Larock, Comprehensive Organic Transformations; from memory",
    example { "Cc1ccc(cc1)S(=O)(=O)N(CC=C)CC(=O)OC", from = { "Cc1ccc(cc1)S(=O)(=O)NCC(=O)OC", "C=CCBr" } },
    refuse { "CS(=O)(=O)NC(C)(C)C" }, -- N-H left and a tertiary alkyl group
}

disconnection "amide-n-alkylation" {
    about = "Amide N-alkylation; N before O in polar aprotic solvent",
    rxno = "RXNO:0000340",
    target = "[#6:1][C;X3:2](=[O;X1:3])[N;X3;H0:4]([#6:5])-!@[C;X4;H3,$([C;H2][#6;!$([C;X4;H0])]):6]",
    cut = { 6, 4 },
    acceptor = { 6, "alkyl" },
    donor = { 4, "amide-nitrogen" },
    conditions = "alkylation",
    also_attacks = { "alkyl halide", "acyl halide", "ester", "ketone", "free alcohol", "phenol", "thiol",
        "free acid", "epoxide" },
    recipe = "NaH, DMF or THF, 0 °C to rt; also: I, Cl, OTs",
    yield = { 70, 92 },
    cautions = { "sodium hydride", "N,N-dimethylformamide" },
    source = "Larock, Comprehensive Organic Transformations; from memory",
    example { "O=C1CCCCN1Cc1ccc(Cl)cc1", from = { "O=C1CCCCN1", "BrCc1ccc(Cl)cc1" } },
    refuse { "CC(=O)NC(C)(C)C" }, -- N-H left and a tertiary alkyl group
}

disconnection "aniline-n-alkylation-halide" {
    about = "Monoalkylation of an aniline (aniline N-alkylation); monoalkylation with excess aniline",
    rxno = "RXNO:0000341",
    target = "[c:1][N;X3;H1:2]-!@[C;X4;H2;$(C-[CX3]=O),$(C-c),$(C-C=C):3]",
    cut = { 3, 2 },
    acceptor = { 3, "alkyl" },
    donor = { 2, "amine" },
    conditions = "alkylation",
    also_attacks = { "alkyl halide", "acyl halide", "primary amine", "phenol", "thiol", "free acid",
        "epoxide" },
    recipe = "NaOAc or iPr2NEt, EtOH or MeCN, 60-80 °C; also: alkyl chloride with KI",
    yield = { 60, 85 },
    cautions = { "ethyl bromoacetate" },
    source = "Vogel's Textbook of Practical Organic Chemistry; from memory",
    example { "CCOC(=O)CNc1ccc(F)cc1", from = { "Nc1ccc(F)cc1", "CCOC(=O)CBr" } },
    refuse { "CCOC(=O)CN(C)c1ccccc1" }, -- a second N-alkyl group: over-alkylation
}

disconnection "chloroacetamide-amine" {
    about = "Alkylation of an amine by an α-chloroacetamide; primary amines need excess",
    target = "[N;X3;!$(N-[C,S]=[O,S,N]);!$(N-c);!$(N-[N,O]):1]-!@[C;X4;H2:2][C;X3:3](=[O:4])[N:5]",
    cut = { 2, 1 },
    acceptor = { 2, "alkyl" },
    donor = { 1, "amine" },
    conditions = "amine-heat",
    also_attacks = { "other primary amine", "alkyl halide", "acyl halide", "thiol", "phenol", "free acid" },
    recipe = "amine (2-3 equiv.), K2CO3, MeCN or toluene, reflux; also: bromoacetamide",
    yield = { 75, 95 },
    source = "Kleemann and Engel, Pharmaceutical Substances; from memory",
    example { "CCN(CC)CC(=O)Nc1c(C)cccc1C", from = { "CCNCC", "Cc1cccc(C)c1NC(=O)CCl" } },
    refuse { "CC(=O)N(C)CC(=O)N(C)C" }, -- an amide nitrogen is no nucleophile
}

disconnection "azide-displacement" {
    about = "Azide displacement of a primary halide; SN2",
    target = "[C;X4;H2:1]([#6;!$([C;X4;H0]):4])[N;X2;+0:2]=[N;+:3]=[N;-:5]",
    from = "[C;X4;H2:1]([#6:4])[Br;X1].[N;-:2]=[N;+:3]=[N;-:5].[Na+]",
    conditions = "alkylation",
    also_attacks = { "alkyl halide", "acyl halide", "epoxide", "terminal alkyne" },
    recipe = "NaN3, DMF or DMSO, rt to 60 °C (no CH2Cl2); also: I, Cl, OMs, OTs",
    yield = { 85, 98 },
    cautions = { "sodium azide", "N,N-dimethylformamide" },
    source = "Clayden, Greeves, Warren, Organic Chemistry; from memory",
    example { "COC(=O)c1ccc(CN=[N+]=[N-])cc1", from = { "COC(=O)c1ccc(CBr)cc1", "[N-]=[N+]=[N-].[Na+]" } },
    refuse { "CC(C)(C)N=[N+]=[N-]" }, -- tertiary halide: no SN2
}

disconnection "hydrazine-alkylation" {
    about = "Alkylation of hydrazine; monoalkylation with a large excess of hydrazine; 1,1-dialkylation is the rival",
    target = "[C;X4;H2:1]([#6;!$([C;X4;H0]):4])-[N;X3;H1:2][N;X3;H2:3]",
    cut = { 1, 2 },
    acceptor = { 1, "alkyl" },
    donor = { 2, "amine" },
    conditions = "alkylation",
    also_attacks = { "alkyl halide", "acyl halide", "ester", "aldehyde", "ketone", "imide", "epoxide" },
    recipe = "N2H4·H2O (10 equiv), EtOH, rt; also: Cl, I",
    yield = { 60, 85 },
    cautions = { "hydrazine" },
    source = "Larock, Comprehensive Organic Transformations; from memory",
    example { "NNCc1ccc(Cl)cc1", from = { "BrCc1ccc(Cl)cc1", "NN" } },
    refuse { "CC(=O)NN" }, -- hydrazide comes from the ester
}

disconnection "guanidine-from-amine" {
    about = "Guanylation of an amine; primary amine before aniline; tautomer drawn with C=NH",
    target = "[C;X4:1][N;X3;H1:2]-[C;X3:3](=[N;X2;H1:4])[N;X3;H2:5]",
    from = "[C;X4:1][N;X3;H2:2].[C;X3:3](=[N;X2;H1:4])([N;X3;H2:5])n1cccn1",
    conditions = "amine-heat",
    also_attacks = { "primary amine", "secondary amine", "acyl halide" },
    recipe = "1H-pyrazole-1-carboxamidine·HCl, iPr2NEt, DMF, rt; also: S-methylisothiourea",
    yield = { 70, 92 },
    cautions = { "N,N-dimethylformamide" },
    source = "March's Advanced Organic Chemistry; from memory",
    example { "N=C(N)NCCc1ccc(Cl)cc1", from = { "NCCc1ccc(Cl)cc1", "N=C(N)n1cccn1" } },
    refuse { "CC(N)=N" }, -- amidine: the carbon bears carbon
}
