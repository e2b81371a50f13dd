-- Nitriles, carboxylic acids, esters, amides.
-- Yields are typical ranges and sources stand from memory unless a source says otherwise.

pack {
    name = "nitriles-acids",
    version = "0.1.0",
    licence = "CC0-1.0",
    about = "Nitriles, carboxylic acids, esters, amides",
    needs = { "synthons" },
}

disconnection "cyanide-displacement" {
    about = "Cyanide displacement of an alkyl halide; SN2 at primary or benzylic carbon",
    target = "[C;X4;H2:1]([#6;!$([C;X4;H0]):4])[C;X2;+0:2]#[N:3]",
    cut = { 1, 2 },
    acceptor = { 1, "alkyl" },
    donor = { 2, "cyanide" },
    conditions = "cyanide",
    also_attacks = { "alkyl halide", "acyl halide", "epoxide", "aldehyde" },
    recipe = "NaCN, DMSO, 40-80 °C; also: Cl with NaI, I, OMs, OTs",
    yield = { 70, 92 },
    cautions = { "sodium cyanide" },
    source = "Clayden, Greeves, Warren, Organic Chemistry; from memory",
    example { "N#CCc1ccc(Cl)c(Cl)c1", from = { "BrCc1ccc(Cl)c(Cl)c1", "[C-]#N.[Na+]" } },
    refuse { "CC(C)(C)C#N" }, -- tertiary halide eliminates with cyanide
}

disconnection "cyanide-displacement-inversion" {
    about = "Cyanide displacement of a secondary sulfonate with inversion; inversion; elimination is the rival",
    target = "[C@;X4;H1:1]([C;X4:4])([C;X4:5])[C;X2;+0:2]#[N:3]",
    from = "[C@@;X4;H1:1]([C;X4:4])([C;X4:5])[O;X2][S;X4](=O)(=O)[C;H3].[C;-:2]#[N:3].[Na+]",
    conditions = "cyanide",
    also_attacks = { "alkyl halide", "acyl halide", "epoxide", "aldehyde" },
    recipe = "NaCN, DMF or DMSO, 50-60 °C; also: OTs, Br; Bu4NCN",
    yield = { 50, 75 },
    cautions = { "sodium cyanide", "N,N-dimethylformamide" },
    source = "Larock, Comprehensive Organic Transformations; from memory",
    example { "CCCCCC[C@H](C)C#N", from = { "CCCCCC[C@@H](C)OS(C)(=O)=O", "[C-]#N.[Na+]" } },
    refuse { "CCC(C)(C)C#N" }, -- tertiary centre: elimination
}

interconversion "nitrile-from-amide" {
    about = "Dehydration of a primary amide; primary amides only",
    target = "[#6:1][C;X2:2]#[N;X1:3]",
    from = "[#6:1][C;X3:2](=[O;X1])[N;X3;H2:3]",
    conditions = "socl2",
    also_attacks = { "free alcohol", "free acid", "primary amine", "secondary amine", "oxime", "phenol" },
    recipe = "TFAA, Et3N, CH2Cl2, 0 °C; also: POCl3; SOCl2, DMF; Burgess reagent",
    yield = { 80, 95 },
    cautions = { "trifluoroacetic anhydride" },
    source = "Carey and Sundberg, Advanced Organic Chemistry, Part B; from memory",
    example { "COC(=O)c1ccc(C#N)nc1", from = { "COC(=O)c1ccc(C(N)=O)nc1" } },
    refuse { "CN(C)C#N" }, -- cyanamide carbon is not bonded to carbon
}

interconversion "nitrile-from-aldoxime" {
    about = "Dehydration of an aldoxime; both oxime isomers react; no amide with Ac2O in heat",
    target = "[#6:1][C;X2:2]#[N;X1:3]",
    from = "[#6:1][C;X3;H1:2]=[N;X2:3][O;H1]",
    conditions = "acylation",
    also_attacks = { "free alcohol", "primary amine", "secondary amine", "phenol", "free acid" },
    recipe = "Ac2O, reflux; also: TFAA, pyridine; CDI; Cu(OAc)2, MeCN",
    yield = { 80, 95 },
    cautions = { "acetic anhydride" },
    source = "Org. Synth. Coll. Vol. 2 (veratronitrile); from memory",
    example { "N#Cc1ccc2OCOc2c1", from = { "ON=Cc1ccc2OCOc2c1" } },
    refuse { "CN(C)C#N" }, -- cyanamide carbon is not bonded to carbon
}

interconversion "acid-from-nitrile" {
    about = "Nitrile to acid conversion (hydrolysis); passes through the primary amide",
    rxno = "RXNO:0000366",
    target = "[#6:1][C;X3:2](=[O;X1])[O;X2;H1]",
    from = "[#6:1][C;X2:2]#[N;X1]",
    conditions = "base-aq-strong",
    also_attacks = { "ester", "amide", "acyl halide", "acetal", "Boc amine", "tert-butyl ester",
        "alkyl halide" },
    recipe = "KOH, H2O-EtOH, reflux; also: H2SO4-AcOH-H2O, reflux",
    yield = { 75, 95 },
    cautions = { "potassium hydroxide" },
    source = "Clayden, Greeves, Warren, Organic Chemistry; from memory",
    example { "OC(=O)Cc1ccc(F)cc1Cl", from = { "N#CCc1ccc(F)cc1Cl" } },
    refuse { "CNC(=O)O" }, -- carbamic acid, no carbon on the carboxyl group
}

interconversion "primary-amide-from-nitrile" {
    about = "Partial hydrolysis of a nitrile to a primary amide; stops at the amide",
    target = "[#6:1][C;X3:2](=[O;X1])[N;X3;H2:3]",
    from = "[#6:1][C;X2:2]#[N;X1:3]",
    conditions = "h2o2-base",
    also_attacks = { "aldehyde", "thiol", "thioether", "boronic acid" },
    recipe = "H2O2, K2CO3, DMSO, 0 °C to rt; also: H2SO4 (conc), rt",
    yield = { 80, 97 },
    cautions = { "hydrogen peroxide" },
    source = "Larock, Comprehensive Organic Transformations; from memory",
    example { "NC(=O)c1cc(Br)ccc1F", from = { "N#Cc1cc(Br)ccc1F" } },
    refuse { "CNC(=O)c1ccccc1" }, -- secondary amide: hydration of a nitrile gives NH2 only
}

interconversion "acid-from-primary-alcohol" {
    about = "Alcohol oxidation to carboxylic acid; alpha stereocentre kept under TEMPO conditions",
    rxno = "RXNO:0000353",
    target = "[#6:1][C;X3;H0:2](=[O;X1:3])[O;X2;H1]",
    from = "[#6:1][C;X4;H2:2][O;X2;H1:3]",
    conditions = "chromic",
    also_attacks = { "free alcohol", "aldehyde", "thiol", "thioether", "primary amine", "secondary amine",
        "phenol" },
    recipe = "TEMPO (cat), PhI(OAc)2, MeCN-H2O, rt; also: NaClO2, NaOCl, TEMPO; Jones reagent",
    yield = { 75, 95 },
    cautions = { "chromium trioxide" },
    source = "Carey and Sundberg, Advanced Organic Chemistry, Part B; from memory",
    example { "OC(=O)[C@H]1CCCN1C(=O)OC(C)(C)C", from = { "OC[C@H]1CCCN1C(=O)OC(C)(C)C" } },
    refuse { "CNC(=O)O" }, -- carbamic acid, no carbon on the carboxyl group
}

disconnection "fischer-esterification" {
    about = "Fischer-Speier esterification; acyl C-O bond formed; excess alcohol drives the equilibrium",
    rxno = "RXNO:0000167",
    target = "[#6:1][C;X3:2](=[O;X1:3])-!@[O;X2:4]-!@[C;X4;H3,$([C;H2][#6]):5]",
    cut = { 2, 4 },
    acceptor = { 2, "acyl-acid" },
    donor = { 4, "alcohol" },
    conditions = "acid-dry-strong",
    also_attacks = { "free acid", "acetal", "silyl ether", "Boc amine", "tert-butyl ester", "epoxide",
        "nitrile" },
    recipe = "H2SO4 (cat), alcohol as solvent, reflux; also: SOCl2, MeOH; TsOH",
    yield = { 75, 95 },
    cautions = { "sulfuric acid" },
    source = "Clayden, Greeves, Warren, Organic Chemistry; from memory",
    example { "CCOC(=O)c1ccc(N)cc1", from = { "OC(=O)c1ccc(N)cc1", "CCO" } },
    refuse { "CC(=O)OC(C)(C)C" }, -- tertiary alcohol dehydrates in strong acid
}

disconnection "ester-from-acid-chloride" {
    about = "O-Acylation to ester with an acid chloride; configuration of the alcohol kept",
    rxno = "RXNO:0000360",
    target = "[#6:1][C;X3:2](=[O;X1:3])-!@[O;X2:4][#6;!$(C=[O,N,S]);!$([C;X3]=[C;X3]):5]",
    cut = { 2, 4 },
    acceptor = { 2, "acyl" },
    donor = { 4, "alcohol" },
    conditions = "acylation",
    also_attacks = { "primary amine", "secondary amine", "phenol", "thiol", "free alcohol" },
    recipe = "Et3N or pyridine, DMAP (cat), CH2Cl2, 0 °C to rt",
    yield = { 80, 97 },
    cautions = { "pyridine", "4-dimethylaminopyridine" },
    source = "Clayden, Greeves, Warren, Organic Chemistry; from memory",
    example { "O=C(Oc1ccc(cc1)[N+](=O)[O-])C1CCCCC1", from = { "O=C(Cl)C1CCCCC1", "Oc1ccc(cc1)[N+](=O)[O-]" } },
    refuse { "CC(=O)OC(C)=O" }, -- anhydride, not an ester
}

disconnection "carboxylate-alkylation" {
    about = "Alkylation of a carboxylate; alpha centre kept; acid before alcohol",
    target = "[#6:1][C;X3:2](=[O;X1:3])-!@[O;X2:4]-!@[C;X4;H2:5][#6;!$([C;X4;H0]):6]",
    cut = { 5, 4 },
    acceptor = { 5, "alkyl" },
    donor = { 4, "carboxylate" },
    conditions = "alkylation",
    also_attacks = { "phenol", "thiol", "primary amine", "secondary amine", "alkyl halide" },
    recipe = "K2CO3 or Cs2CO3, DMF, rt; also: I, Cl, OTs; MeI for methyl",
    yield = { 80, 97 },
    cautions = { "N,N-dimethylformamide" },
    source = "Larock, Comprehensive Organic Transformations; from memory",
    example { "C=CCOC(=O)[C@H](C(C)C)NC(=O)OC(C)(C)C", from = { "OC(=O)[C@H](C(C)C)NC(=O)OC(C)(C)C", "C=CCBr" } },
    refuse { "CC(=O)OCC(C)(C)C" }, -- neopentyl halide is too slow in SN2
}

disconnection "steglich-esterification" {
    about = "Steglich esterification; configuration of the alcohol kept; works for hindered alcohols",
    rxno = "RXNO:0000586",
    target = "[#6:1][C;X3:2](=[O;X1:3])-!@[O;X2:4]-!@[C;X4;H1,H0:5]",
    cut = { 2, 4 },
    acceptor = { 2, "acyl-acid" },
    donor = { 4, "alcohol" },
    conditions = "acylation",
    also_attacks = { "primary amine", "secondary amine", "phenol", "thiol", "free alcohol", "free acid" },
    recipe = "DCC, DMAP (cat), CH2Cl2, 0 °C to rt; also: EDC",
    yield = { 70, 92 },
    cautions = { "dicyclohexylcarbodiimide", "4-dimethylaminopyridine" },
    source = "B. Neises and W. Steglich, Angew. Chem. Int. Ed. Engl. 1978, 17, 522; from memory",
    example { "O=C(OC1CCCC1)C(NC(=O)OCc1ccccc1)C", from = { "OC(=O)C(NC(=O)OCc1ccccc1)C", "OC1CCCC1" } },
    refuse { "CC(=O)Oc1ccccc1" }, -- aryl ester: the general acid chloride rule is used
}

disconnection "amide-coupling" {
    about = "Amide coupling of an acid with an amine; alpha centre kept with carbamate-protected amino acids; primary amine before aniline",
    rxno = "RXNO:0000357",
    target = "[#6;!$([CX4]-[NX3;H1,H2;+0;!$(N-[C,S]=[O,S,N]);!$(N-c)]):1][C;X3:2](=[O;X1:3])-!@[N;X3;!$(N(C=O)[C,S]=[O,S,N]);!$(N[#7,#8]):4]",
    cut = { 2, 4 },
    acceptor = { 2, "acyl-acid" },
    donor = { 4, "amine" },
    conditions = "acylation",
    also_attacks = { "primary amine", "secondary amine", "free acid", "thiol", "phenol" },
    recipe = "HATU or EDC-HOBt, iPr2NEt, DMF or CH2Cl2, 0 °C to rt; also: T3P, CDI",
    yield = { 75, 95 },
    cautions = { "HATU", "N,N-dimethylformamide" },
    source = "Clayden, Greeves, Warren, Organic Chemistry; from memory",
    example { "COC(=O)[C@H](Cc1ccccc1)NC(=O)[C@H](C)NC(=O)OC(C)(C)C", from = { "C[C@@H](C(=O)O)NC(=O)OC(C)(C)C", "COC(=O)[C@@H](N)Cc1ccccc1" } },
    refuse { "NCC(=O)NCc1ccccc1" }, -- the free amine of an amino acid couples with itself
    refuse { "CNC(=O)OC" }, -- carbamate: no carbon on the acyl side
}

disconnection "schotten-baumann" {
    about = "Schotten-Baumann reaction; amine before alcohol and water",
    rxno = "RXNO:0000165",
    target = "[#6;!$([CX4]-[NX3;H1,H2;+0;!$(N-[C,S]=[O,S,N]);!$(N-c)]):1][C;X3:2](=[O;X1:3])-!@[N;X3;!$(N(C=O)[C,S]=[O,S,N]);!$(N[#7,#8]):4]",
    cut = { 2, 4 },
    acceptor = { 2, "acyl" },
    donor = { 4, "amine" },
    conditions = "acylation",
    also_attacks = { "primary amine", "secondary amine", "free alcohol", "phenol", "thiol" },
    recipe = "NaOH, H2O-CH2Cl2, 0 °C; also: Et3N, CH2Cl2",
    yield = { 80, 97 },
    cautions = { "sodium hydroxide" },
    source = "Clayden, Greeves, Warren, Organic Chemistry; from memory",
    example { "O=C(NCCN1CCOCC1)c1ccc(Cl)cc1", from = { "O=C(Cl)c1ccc(Cl)cc1", "NCCN1CCOCC1" } },
    refuse { "NCC(=O)NCc1ccccc1" }, -- no acid chloride beside a free amine
    refuse { "CN(C)C(=O)N(C)C" }, -- urea: no carbon on the acyl side
}

disconnection "ester-aminolysis" {
    about = "Aminolysis of a methyl ester; primary alkylamines and ammonia; slow with hindered partners",
    target = "[#6;!$([CX4;H0]);!$([CX4]-[NX3;H1,H2;+0;!$(N-[C,S]=[O,S,N]);!$(N-c)]):1][C;X3:2](=[O;X1:3])-!@[N;X3;$([H2]),$([H1]-[CX4;H2,H3]),$([H1]-[CX4;R]);!$(N-[CX4]-C(=O)[OX2H1]);!$(N[#7,#8]);!$(Nc):4]",
    cut = { 2, 4 },
    acceptor = { 2, "acyl-methyl-ester" },
    donor = { 4, "amine" },
    conditions = "amine-heat",
    also_attacks = { "amidine", "thiourea", "ester", "acyl halide", "anhydride", "epoxide", "alkyl halide", "aldehyde" },
    recipe = "neat or MeOH, 60-120 °C; also: AlMe3 or TBD; ethyl ester",
    yield = { 65, 92 },
    source = "March's Advanced Organic Chemistry; from memory",
    example { "CCN(CC)CCNC(=O)c1cc(Cl)c(N)cc1OC", from = { "COC(=O)c1cc(Cl)c(N)cc1OC", "CCN(CC)CCN" } },
    refuse { "CC(=O)Nc1ccccc1" }, -- anilines are too weak for unactivated esters
}

disconnection "acetanilide" {
    about = "N-Acylation to amide with acetic anhydride; N before O",
    rxno = "RXNO:0000357",
    target = "[c:1][N;X3;H1:2]-!@[C;X3:3](=[O;X1:4])[C;X4;H3:5]",
    cut = { 3, 2 },
    acceptor = { 3, "acetyl" },
    donor = { 2, "amine" },
    conditions = "acylation",
    also_attacks = { "primary amine", "secondary amine", "thiol", "phenol", "free alcohol" },
    recipe = "Ac2O, H2O or AcOH, rt to 60 °C; also: AcCl, Et3N",
    yield = { 85, 97 },
    cautions = { "acetic anhydride" },
    source = "Vogel’s Textbook of Practical Organic Chemistry; from memory",
    example { "CC(=O)Nc1ccc(O)cc1", from = { "Nc1ccc(O)cc1", "CC(=O)OC(C)=O" } },
    refuse { "CC(=O)Oc1ccccc1" }, -- ester oxygen, not an anilide nitrogen
}

disconnection "weinreb-amide" {
    about = "Weinreb amide formation; alpha centre kept",
    target = "[#6:1][C;X3:2](=[O;X1:3])[N;X3:4]([C;H3:5])[O;X2:6][C;H3:7]",
    cut = { 2, 4 },
    acceptor = { 2, "acyl-acid" },
    donor = { 4, "amine" },
    conditions = "acylation",
    also_attacks = { "primary amine", "secondary amine", "free acid", "thiol", "phenol" },
    recipe = "MeNHOMe·HCl, EDC or CDI, Et3N, CH2Cl2, 0 °C to rt; also: acid chloride; ester with iPrMgCl",
    yield = { 80, 96 },
    source = "S. Nahm and S. M. Weinreb, Tetrahedron Lett. 1981, 22, 3815; from memory",
    example { "CON(C)C(=O)[C@H](CC(C)C)NC(=O)OC(C)(C)C", from = { "OC(=O)[C@H](CC(C)C)NC(=O)OC(C)(C)C", "CNOC" } },
    refuse { "CN(C)C(=O)c1ccccc1" }, -- no methoxy group on nitrogen
}

disconnection "carbamate-from-chloroformate" {
    about = "N-Acylation to carbamate with a chloroformate; N before O",
    rxno = "RXNO:0000359",
    target = "[N;X3;!$(N(C=O)[C,S]=[O,S,N]):1]-!@[C;X3:2](=[O;X1:3])-!@[O;X2:4][C;X4;H3,H2:5]",
    cut = { 2, 1 },
    acceptor = { 2, "alkoxycarbonyl" },
    donor = { 1, "amine" },
    conditions = "acylation",
    also_attacks = { "primary amine", "secondary amine", "free alcohol", "phenol", "thiol" },
    recipe = "K2CO3 or Et3N, CH2Cl2-H2O, 0 °C",
    yield = { 85, 97 },
    cautions = { "ethyl chloroformate" },
    source = "March's Advanced Organic Chemistry; from memory",
    example { "CCOC(=O)N1CCC(=O)CC1", from = { "O=C1CCNCC1", "CCOC(=O)Cl" } },
    refuse { "CC(C)(C)OC(=O)N1CCCC1" }, -- tert-butyl chloroformate is not stable (use Boc2O)
}

disconnection "urea-from-isocyanate" {
    about = "N-Acylation to urea with an isocyanate; no by-product",
    rxno = "RXNO:0000358",
    target = "[#6:1][N;X3;H1:2]-!@[C;X3:3](=[O;X1:4])-!@[N;X3;!$(N(C=O)[C,S]=[O,S,N]):5]",
    cut = { 3, 5 },
    acceptor = { 3, "carbamoyl" },
    donor = { 5, "amine" },
    conditions = "amine-rt",
    also_attacks = { "primary amine", "secondary amine", "free alcohol", "phenol", "thiol" },
    recipe = "CH2Cl2 or THF, 0 °C to rt",
    yield = { 85, 98 },
    cautions = { "isocyanates" },
    source = "Warren and Wyatt, Organic Synthesis: The Disconnection Approach; from memory",
    example { "CN(C)C(=O)Nc1ccc(Cl)c(Cl)c1", from = { "O=C=Nc1ccc(Cl)c(Cl)c1", "CNC" } },
    refuse { "CN(C)C(=O)N(C)C" }, -- tetrasubstituted urea has no N-H for the isocyanate half
}

interconversion "hofmann-rearrangement" {
    about = "Hofmann rearrangement; one carbon fewer; migrating group keeps its configuration",
    rxno = "RXNO:0000410",
    target = "[#6;$(c),$([C;X4]):1][N;X3;H2:2]",
    from = "[#6:1][C;X3](=[O;X1])[N;X3;H2:2]",
    conditions = "base-aq-strong",
    also_attacks = { "ester", "alkene", "phenol", "aniline", "aldehyde", "ketone", "thiol" },
    recipe = "NaOCl or Br2, NaOH, H2O, 0-70 °C; also: PhI(OCOCF3)2, MeCN-H2O",
    yield = { 65, 90 },
    cautions = { "bromine", "sodium hypochlorite", "sodium hydroxide" },
    source = "Kürti and Czakó, Strategic Applications of Named Reactions in Organic Synthesis; from memory",
    example { "NCC1(CC(=O)O)CCCCC1", from = { "NC(=O)CC1(CC(=O)O)CCCCC1" } },
    refuse { "CNCC1CCCCC1" }, -- secondary amine is not formed from a primary amide
}

interconversion "baeyer-villiger" {
    about = "Baeyer-Villiger oxidation (methyl ketone); tertiary > secondary > aryl > primary > methyl; retention at the migrating carbon",
    rxno = "RXNO:0000031",
    target = "[C;X4;H1,H0;!$(C([#8])[#7,#8,#16]):1]-!@[O;X2][C;X3:3](=[O;X1:4])[C;X4;H3:5]",
    from = "[C;X4:1][C;X3:3](=[O;X1:4])[C;X4;H3:5]",
    conditions = "mcpba",
    also_attacks = { "alkene", "primary amine", "secondary amine", "tertiary amine", "thioether", "thiol",
        "aldehyde", "ketone" },
    recipe = "mCPBA, NaHCO3, CH2Cl2, rt; also: CF3CO3H, Na2HPO4",
    yield = { 70, 92 },
    cautions = { "3-chloroperbenzoic acid" },
    source = "G. R. Krow, Org. React. 1993, 43, 251; from memory",
    example { "CC(=O)O[C@H]1CC[C@@H](CC1)C(C)(C)C", from = { "CC(=O)[C@H]1CC[C@@H](CC1)C(C)(C)C" } },
    refuse { "CC(=O)OCC" }, -- primary alkyl migrates too slowly beside methyl
}

interconversion "beckmann-lactam" {
    about = "Cyclic Beckmann rearrangement; anti group migrates; symmetrical ketones give one lactam",
    rxno = "RXNO:0000574",
    target = "[C;X4;H2;R:2]@[C;X3;R:1](=[O;X1])@[N;X3;H1;R:3]@[C;X4;H2;R:4]",
    from = "[C;X4;H2;R:2][C;X3;R:1](=[N;X2;H0:3][O;H1])[C;X4;H2;R:4]",
    conditions = "acid-aq-strong",
    also_attacks = { "free alcohol", "primary amine", "secondary amine", "acetal", "tert-butyl ester",
        "Boc amine" },
    recipe = "TsCl, NaOH, acetone-H2O; also: H2SO4; PPA",
    yield = { 65, 90 },
    cautions = { "4-toluenesulfonyl chloride", "sodium hydroxide" },
    source = "Kürti and Czakó, Strategic Applications of Named Reactions in Organic Synthesis; from memory",
    example { "O=C1CCC(CCN1)c1ccccc1", from = { "ON=C1CCC(CC1)c1ccccc1" } },
    refuse { "O=C1NC(C)CCCC1" }, -- unsymmetrical ketone: the anti isomer of the oxime decides which carbon migrates
}

interconversion "cyclohexene-to-adipic-acid" {
    about = "Oxidative cleavage of a cyclohexene to a 1,6-diacid (alkene oxidative cleavage); ring stereocentres kept",
    rxno = "RXNO:0000344",
    target = "[O;H1][C;X3:1](=[O])[C;X4;H2:2][C;X4:3][C;X4:4][C;X4;H2:5][C;X3:6](=[O])[O;H1]",
    from = "[C;H1:1]1=[C;H1:6][C:5][C:4][C:3][C:2]1",
    conditions = "kmno4",
    also_attacks = { "free alcohol", "aldehyde", "primary amine", "thioether", "other alkene", "phenol" },
    recipe = "KMnO4, phase transfer or acetone/H2O, 0 °C; also: O3 then H2O2/HCO2H, RuCl3/NaIO4, H2O2/Na2WO4",
    yield = { 65, 88 },
    cautions = { "potassium permanganate" },
    source = "Vogel's Textbook of Practical Organic Chemistry; from memory",
    example { "COC(=O)C(CC(=O)O)C(CC(=O)O)C(=O)OC", from = { "COC(=O)C1CC=CCC1C(=O)OC" } },
    refuse { "OC(=O)CCCC(=O)O" }, -- glutaric acid: comes from a cyclopentene
}

disconnection "benzylic-carbonylation" {
    about = "Carbonylation of a benzylic alcohol to the acid",
    target = "[c:3][CX4;H1,H2:1]-!@[CX3;+0:2](=[OX1;+0:4])[OX2H]",
    from = "[c:3][C:1][OX2H].[C-:2]#[O+:4]",
    conditions = "pd0",
    also_attacks = { "aryl iodide", "aryl bromide", "other benzylic alcohol" },
    recipe = "CO (30-50 bar), PdCl2(PPh3)2, aqueous HCl, 100-130 °C",
    yield = { 70, 96 },
    cautions = { "carbon monoxide" },
    source = "Elango et al., US 4981995; from memory",
    example { "CC(C)Cc1ccc(C(C)C(=O)O)cc1", from = { "CC(C)Cc1ccc(C(C)O)cc1", "[C-]#[O+]" } },
    refuse { "O=C(O)CCc1ccccc1" }, -- the alcohol would not be benzylic
}

disconnection "mitsunobu-esterification" {
    about = "Ester of a secondary alcohol with inversion",
    target = "[C@;X4;H1:1]([C:4])([C:5])-!@[OX2:2]-[CX3:3](=[OX1:6])[c:7]",
    from = "[C@@;X4;H1:1]([C:4])([C:5])[OX2H].[OX2H:2][C:3](=[O:6])[c:7]",
    conditions = "mitsunobu",
    also_attacks = { "other alcohol", "phenol", "other acid", "thiol", "imide" },
    recipe = "DEAD or DIAD, PPh3, THF, 0 °C to rt",
    yield = { 65, 88 },
    cautions = { "diethyl azodicarboxylate" },
    source = "Dodge, Nissen, Presnell, Org. Synth. Coll. Vol. 9, 607; from memory",
    example { "CC(C)[C@@H]1CC[C@@H](C)C[C@@H]1OC(=O)c1ccc([N+](=O)[O-])cc1",
        from = { "CC(C)[C@@H]1CC[C@@H](C)C[C@H]1O", "O=C(O)c1ccc([N+](=O)[O-])cc1" } },
    refuse { "CC(C)(C)OC(=O)c1ccccc1" }, -- a tertiary alcohol does not invert
}

disconnection "aryl-acetate-from-anhydride" {
    about = "O-Acetylation of a phenol with acetic anhydride",
    target = "[c:1][OX2:2]-!@[CX3:3](=[OX1:4])[CH3:5]",
    cut = { 3, 2 },
    acceptor = { 3, "acetyl" },
    donor = { 2, "phenol" },
    conditions = "acylation",
    also_attacks = { "primary amine", "secondary amine", "alcohol", "thiol", "other phenol" },
    recipe = "Ac2O, cat. H2SO4 or H3PO4, 50-80 °C; or Ac2O, pyridine, rt",
    yield = { 75, 95 },
    cautions = { "acetic anhydride" },
    source = "Vogel's Textbook of Practical Organic Chemistry; from memory",
    example { "CC(=O)Oc1ccccc1C(=O)O", from = { "O=C(O)c1ccccc1O", "CC(=O)OC(C)=O" } },
    refuse { "CC(=O)Oc1ccccc1N" }, -- the free amine would be acylated first
    when = function(m) return not m.molecule:has "[NX3;H1,H2;+0;!$(N[C,S]=[O,S,N])]" end,
}

interconversion "lindgren-oxidation" {
    about = "Lindgren oxidation; alkene, alcohol and silyl ether survive; scavenger takes up HOCl",
    rxno = "RXNO:0000287",
    target = "[#6:1][C;X3;H0:2](=[O;X1:3])[O;X2;H1]",
    from = "[#6:1][C;X3;H1:2]=[O;X1:3]",
    conditions = "tempo",
    also_attacks = { "aldehyde", "thioether", "aniline" },
    recipe = "NaClO2, NaH2PO4, 2-methylbut-2-ene, tBuOH-H2O, rt",
    yield = { 85, 98 },
    cautions = { "sodium chlorite" },
    source = "Kürti and Czakó, Strategic Applications of Named Reactions in Organic Synthesis; from memory",
    example { "OC(=O)/C=C/c1ccc(O[Si](C)(C)C(C)(C)C)cc1", from = { "O=C/C=C/c1ccc(O[Si](C)(C)C(C)(C)C)cc1" } },
    example { "OC(=O)/C=C/c1ccccc1", from = { "O=C/C=C/c1ccccc1" } },
    refuse { "CNC(=O)O" }, -- carbamic acid, no carbon on the carboxyl group
}

disconnection "methyl-ester-diazomethane" {
    about = "Methyl ester with diazomethane; acid before alcohol; neutral, no epimerisation",
    target = "[#6:1][C;X3:2](=[O;X1:3])-!@[O;X2:4][C;X4;H3:5]",
    from = "[#6:1][C;X3:2](=[O;X1:3])[O;X2;H1:4].[C;H2:5]=[N+]=[N-]",
    conditions = "acid-aq-mild",
    also_attacks = { "phenol", "free acid", "enone", "thiol" },
    recipe = "CH2N2, Et2O, 0 °C; also: TMSCHN2, toluene-MeOH",
    yield = { 90, 99 },
    cautions = { "diazomethane" },
    source = "March's Advanced Organic Chemistry; from memory",
    example { "COC(=O)C1(O)CC(O)C(O)C(O)C1", from = { "OC(=O)C1(O)CC(O)C(O)C(O)C1", "C=[N+]=[N-]" } },
    example { "COC(=O)C1CCCCC1", from = { "OC(=O)C1CCCCC1", "C=[N+]=[N-]" } },
    refuse { "CCOC(=O)C" }, -- ethyl ester: diazomethane gives methyl esters
}

disconnection "transesterification" {
    about = "Transesterification of a methyl ester; equilibrium: distil methanol off or use excess alcohol",
    target = "[#6:1][C;X3:2](=[O;X1:3])-!@[O;X2:4]-!@[C;X4;H2;$(C-[#6]):5]",
    cut = { 2, 4 },
    acceptor = { 2, "acyl-methyl-ester" },
    donor = { 4, "alcohol" },
    conditions = "alkoxide",
    recipe = "NaOMe or Ti(OiPr)4 (cat), alcohol, reflux; also: K2CO3; ethyl ester",
    yield = { 75, 95 },
    cautions = { "sodium methoxide" },
    source = "Clayden, Greeves, Warren, Organic Chemistry; from memory",
    example { "CCCCOC(=O)c1cccnc1", from = { "COC(=O)c1cccnc1", "CCCCO" } },
    example { "CCCCOC(=O)C=C", from = { "COC(=O)C=C", "CCCCO" } },
    refuse { "CC(=O)OC(C)(C)C" }, -- tertiary alkoxide does not exchange in good yield
}

disconnection "mixed-anhydride" {
    about = "Anhydride from an acid and an acid chloride; mixed anhydrides disproportionate on heating: use at once",
    target = "[#6:1][C;X3:2](=[O;X1:3])-!@[O;X2:4]-!@[C;X3:5](=[O;X1:6])[#6:7]",
    cut = { 5, 4 },
    acceptor = { 5, "acyl" },
    donor = { 4, "carboxylate" },
    conditions = "acylation",
    recipe = "Et3N or pyridine, Et2O or THF, 0 °C",
    yield = { 80, 95 },
    cautions = { "pyridine" },
    source = "March's Advanced Organic Chemistry; from memory",
    example { "CC(C)(C)C(=O)OC(=O)c1ccccc1Cl", from = { "OC(=O)c1ccccc1Cl", "CC(C)(C)C(=O)Cl" } },
    example { "CCCC(=O)OC(=O)C(C)(C)C", from = { "CCCC(=O)O", "CC(C)(C)C(=O)Cl" } },
    refuse { "O=C1CCC(=O)O1" }, -- cyclic anhydride comes from the diacid
}

interconversion "cyclic-anhydride" {
    about = "Cyclic anhydride from a 1,4-diacid; five-membered ring; cis relation in rings",
    target = "[C;X3;r5:1]1(=[O;X1:2])[O;X2;r5:3][C;X3;r5:4](=[O;X1:5])[#6;r5:6]~[#6;r5:7]1",
    from = "[C;X3:1](=[O;X1:2])([O;X2;H1:3])[#6:7]~[#6:6][C;X3:4](=[O;X1:5])[O;H1]",
    conditions = "acylation",
    recipe = "Ac2O, reflux; also: SOCl2; TFAA, rt",
    yield = { 85, 97 },
    cautions = { "acetic anhydride" },
    source = "March's Advanced Organic Chemistry; from memory",
    example { "O=C1OC(=O)c2cc(F)ccc12", from = { "OC(=O)c1cc(F)ccc1C(=O)O" } },
    example { "O=C1CCC(=O)O1", from = { "OC(=O)CCC(=O)O" } },
    refuse { "CC(=O)OC(C)=O" }, -- open-chain anhydride
}

disconnection "amide-acid-from-cyclic-anhydride" {
    about = "Ring opening of a cyclic anhydride by an amine; one acyl group; unsymmetrical anhydrides give isomers",
    target = "[O;X2;H1:1][C;X3:2](=[O;X1:3])[#6:4]~[#6:5][C;X3:6](=[O;X1:7])-!@[N;X3:8]",
    from = "[O;X2;H0:1]1[C;X3:2](=[O;X1:3])[#6:4]~[#6:5][C;X3:6]1=[O;X1:7].[N;X3:8]",
    conditions = "amine-rt",
    also_attacks = { "primary amine", "secondary amine", "free alcohol", "phenol", "thiol" },
    recipe = "THF or EtOAc, rt; base for alcohols",
    yield = { 85, 97 },
    source = "Warren and Wyatt, Organic Synthesis: The Disconnection Approach; from memory",
    example { "OC(=O)CCC(=O)Nc1ccc(I)cc1", from = { "O=C1CCC(=O)O1", "Nc1ccc(I)cc1" } },
    example { "OC(=O)CCC(=O)NCc1ccccc1", from = { "O=C1CCC(=O)O1", "NCc1ccccc1" } },
    refuse { "OC(=O)CC(=O)Nc1ccccc1" }, -- malonic half-amide: the four-membered anhydride is not available
}

disconnection "hydrazide-from-ester" {
    about = "Hydrazinolysis of an ester; monoacylation with excess hydrazine",
    target = "[#6:1][C;X3:2](=[O;X1:3])[N;X3;H1:4][N;X3;H2:5]",
    cut = { 2, 4 },
    acceptor = { 2, "acyl-simple-ester" },
    donor = { 4, "amine" },
    conditions = "hydrazine",
    recipe = "N2H4·H2O (excess), EtOH, reflux; also: ethyl ester",
    yield = { 80, 97 },
    cautions = { "hydrazine" },
    source = "March's Advanced Organic Chemistry; from memory",
    example { "NNC(=O)c1ccncc1", from = { "COC(=O)c1ccncc1", "NN" } },
    example { "NNC(=O)c1ccccc1", from = { "CCOC(=O)c1ccccc1", "NN" } },
    refuse { "CN(N)C(=O)c1ccccc1" }, -- N-methyl hydrazide needs methylhydrazine
}

disconnection "hydroxamic-acid" {
    about = "Hydroxamic acid from an ester; N-acylation",
    target = "[#6:1][C;X3:2](=[O;X1:3])[N;X3;H1:4][O;X2;H1:5]",
    cut = { 2, 4 },
    acceptor = { 2, "acyl-simple-ester" },
    donor = { 4, "amine" },
    conditions = "base-aq-mild",
    also_attacks = { "ester", "aldehyde", "ketone", "enone" },
    recipe = "NH2OH·HCl, NaOMe or KOH, MeOH, 0 °C to rt; also: ethyl ester",
    yield = { 65, 90 },
    cautions = { "hydroxylamine hydrochloride", "potassium hydroxide", "sodium methoxide" },
    source = "March's Advanced Organic Chemistry; from memory",
    example { "O=C(CCCCCCC(=O)NO)Nc1ccccc1", from = { "COC(=O)CCCCCCC(=O)Nc1ccccc1", "NO" } },
    example { "ONC(=O)c1ccccc1", from = { "CCOC(=O)c1ccccc1", "NO" } },
    refuse { "CONC(=O)c1ccccc1" }, -- O-alkyl hydroxamate needs an alkoxyamine
}

disconnection "isocyanate-from-amine" {
    about = "Isocyanate from an amine and phosgene equivalent; low concentration of amine avoids the urea",
    target = "[#6:1][N;X2:2]=[C;X2:3]=[O;X1:4]",
    from = "[#6:1][N;X3;H2:2].[Cl;X1][C;X3:3](=[O;X1:4])[Cl;X1]",
    conditions = "acylation",
    recipe = "triphosgene (0.35 equiv), Et3N or sat. NaHCO3, CH2Cl2, 0 °C",
    yield = { 75, 95 },
    cautions = { "phosgene", "triphosgene" },
    source = "March's Advanced Organic Chemistry; from memory",
    example { "O=C=Nc1ccc(Cl)c(C(F)(F)F)c1", from = { "Nc1ccc(Cl)c(C(F)(F)F)c1", "ClC(Cl)=O" } },
    example { "O=C=Nc1ccccc1", from = { "Nc1ccccc1", "ClC(Cl)=O" } },
    refuse { "CN=C=S" }, -- isothiocyanate needs thiophosgene or CS2
}

interconversion "curtius-isocyanate" {
    about = "Curtius rearrangement to an isocyanate; migrating group keeps its configuration",
    rxno = "RXNO:0000054",
    target = "[#6:1][N;X2:2]=[C;X2:3]=[O;X1:4]",
    from = "[#6:1][C;X3:3](=[O;X1:4])[N;X2:2]=[N+]=[N-]",
    conditions = "heat-200",
    also_attacks = { "primary amine", "secondary amine", "free alcohol", "phenol", "thiol", "free acid" },
    recipe = "toluene, 80-110 °C, behind a shield",
    yield = { 75, 95 },
    cautions = { "acyl azides" },
    source = "Kürti and Czakó, Strategic Applications of Named Reactions in Organic Synthesis; from memory",
    example { "COC(=O)[C@@H]1CC[C@H](CC1)N=C=O", from = { "COC(=O)[C@@H]1CC[C@H](CC1)C(=O)N=[N+]=[N-]" } },
    example { "O=C=Nc1ccccc1", from = { "[N-]=[N+]=NC(=O)c1ccccc1" } },
    refuse { "CN=C=S" }, -- isothiocyanate is not formed
}

disconnection "curtius-boc-amine" {
    about = "Curtius rearrangement in tert-butanol (one pot); migrating group keeps its configuration",
    rxno = "RXNO:0000054",
    target = "[#6;$(c),$([C;X4]);!$(C-[CX3]=O):1][N;X3;H1:2]-!@[C;X3:3](=[O;X1:4])[O;X2:5][C;X4;H0:6]([C;H3:7])([C;H3:8])[C;H3:9]",
    from = "[#6:1][C;X3:3](=[O;X1:4])[O;H1].[O;X2;H1:5][C;X4:6]([C;H3:7])([C;H3:8])[C;H3:9].O=P(Oc1ccccc1)(Oc1ccccc1)[N;X2:2]=[N+]=[N-]",
    conditions = "heat-200",
    also_attacks = { "primary amine", "secondary amine", "free alcohol", "phenol", "thiol" },
    recipe = "DPPA, Et3N, tBuOH-toluene, 80-100 °C",
    yield = { 60, 85 },
    cautions = { "diphenylphosphoryl azide" },
    source = "T. Shioiri, K. Ninomiya and S. Yamada, J. Am. Chem. Soc. 1972, 94, 6203; from memory",
    example { "CC(C)(C)OC(=O)Nc1cc(Cl)ncc1",
        from = { "OC(=O)c1cc(Cl)ncc1", "CC(C)(C)O", "O=P(Oc1ccccc1)(Oc1ccccc1)N=[N+]=[N-]" } },
    example { "CC(C)(C)OC(=O)NC1CCCCC1",
        from = { "OC(=O)C1CCCCC1", "CC(C)(C)O", "O=P(Oc1ccccc1)(Oc1ccccc1)N=[N+]=[N-]" } },
    refuse { "CC(C)(C)OC(=O)N1CCCC1" }, -- secondary amine: the isocyanate gives N-H carbamates only
}

interconversion "schmidt-acid" {
    about = "Schmidt rearrangement of a carboxylic acid; migrating group keeps its configuration",
    rxno = "RXNO:0000170",
    target = "[#6;$([c;!$(c:c-[N+]);!$(c:[nX2])]),$([C;X4;H1,H0]);!$(C-[CX3]=O):1][N;X3;H2:2]",
    from = "[#6:1][C;X3](=[O;X1])[O;H1].[N;X2;H1:2]=[N+]=[N-]",
    conditions = "acid-aq-strong",
    also_attacks = { "ketone", "aldehyde", "alkene", "free alcohol" },
    recipe = "NaN3, H2SO4, CHCl3, 40-50 °C (hydrazoic acid made in situ)",
    yield = { 60, 85 },
    cautions = { "hydrazoic acid", "sodium azide", "sulfuric acid" },
    source = "March's Advanced Organic Chemistry; from memory",
    example { "NC1CCCCC1", from = { "OC(=O)C1CCCCC1", "N=[N+]=[N-]" } },
    example { "NC1CCCC1", from = { "OC(=O)C1CCCC1", "N=[N+]=[N-]" } },
    refuse { "CNC1CCCCC1" }, -- secondary amine is not formed
}

interconversion "lossen-rearrangement" {
    about = "Lossen rearrangement; migrating group keeps its configuration",
    rxno = "RXNO:0000156",
    target = "[c:1][N;X3;H2:2]",
    from = "[#6:1][C;X3](=[O;X1])[N;X3;H1:2][O;X2;H1]",
    conditions = "base-aq-strong",
    also_attacks = { "primary amine", "secondary amine", "free alcohol", "phenol", "thiol" },
    recipe = "TsCl or CDI, base, MeCN-H2O, heat; also: K2CO3, DMSO, 90-130 °C",
    yield = { 55, 85 },
    cautions = { "hydroxamic acids", "4-toluenesulfonyl chloride" },
    source = "Kürti and Czakó, Strategic Applications of Named Reactions in Organic Synthesis; from memory",
    example { "Nc1ccc(OC)c(OC)c1", from = { "ONC(=O)c1ccc(OC)c(OC)c1" } },
    example { "Nc1ccccc1", from = { "ONC(=O)c1ccccc1" } },
    refuse { "CNc1ccccc1" }, -- secondary amine is not formed
}

disconnection "arndt-eistert" {
    about = "Arndt-Eistert reaction; one carbon more; migrating group keeps its configuration",
    rxno = "RXNO:0000063",
    target = "[#6;!$([CX4]-[CX3]=[CX3]);!$([CX4]-[OX2H1]);!$([CX4]-[NX3;H1,H2]):1][C;X4;H2:2][C;X3:3](=[O;X1:4])[O;X2;H1]",
    from = "[#6:1][C;X3:3](=[O;X1:4])[Cl;X1].[C;H2:2]=[N+]=[N-]",
    conditions = "photo",
    also_attacks = { "pyridine", "tertiary amine", "free acid", "phenol", "aldehyde", "thiol" },
    recipe = "CH2N2 (2-3 equiv), Et2O, 0 °C, then Ag2O or PhCO2Ag, H2O or light",
    yield = { 50, 80 },
    cautions = { "diazomethane" },
    source = "Kürti and Czakó, Strategic Applications of Named Reactions in Organic Synthesis; from memory",
    example { "COc1ccc(CC(=O)O)cc1[N+](=O)[O-]", from = { "COc1ccc(C(=O)Cl)cc1[N+](=O)[O-]", "C=[N+]=[N-]" } },
    example { "OC(=O)Cc1cccc2ccccc12", from = { "O=C(Cl)c1cccc2ccccc12", "C=[N+]=[N-]" } },
    refuse { "CC(C)(C)C(=O)O" }, -- no CH2 beside the acid to come from diazomethane
}

interconversion "baeyer-villiger-lactone" {
    about = "Baeyer-Villiger oxidation (lactone); the more substituted carbon migrates with retention; ring grows by one",
    rxno = "RXNO:0000031",
    target = "[C;X4;R;!$(C([#8])[#7,#8,#16]):1]@[O;X2;R]@[C;X3;R:3](=[O;X1:4])@[C;X4;H2;R:5]",
    from = "[C;X4;R:1][C;X3;R:3](=[O;X1:4])[C;X4;H2;R:5]",
    conditions = "mcpba",
    also_attacks = { "ketone" },
    recipe = "mCPBA, NaHCO3, CH2Cl2, rt; also: H2O2, Lewis acid",
    yield = { 75, 95 },
    cautions = { "3-chloroperbenzoic acid" },
    source = "Clayden, Greeves, Warren, Organic Chemistry; from memory",
    example { "CC1CCCCC(=O)O1", from = { "CC1CCCCC1=O" } },
    example { "O=C1CCCCCO1", from = { "O=C1CCCCC1" } },
    refuse { "CC1CCCCOC1=O" }, -- the more substituted carbon migrates, so oxygen is not on CH2 here
}

disconnection "iodolactonisation" {
    about = "Iodolactonization; 5-exo, anti addition of I and O",
    rxno = "RXNO:0000582",
    target = "[I;X1][C;X4;H2:1][C;X4;r5:2]1[O;X2;r5:3][C;X3;r5:4](=[O;X1:5])[#6;r5:6]~[#6;r5:7]1",
    from = "[C;X3;H2:1]=[C;X3:2][#6:7]~[#6:6][C;X3:4](=[O;X1:5])[O;X2;H1:3]",
    conditions = "br2",
    recipe = "I2, KI, NaHCO3, H2O-CH2Cl2 or MeCN, 0 °C",
    yield = { 75, 95 },
    cautions = { "iodine" },
    source = "M. D. Dowle and D. I. Davies, Chem. Soc. Rev. 1979, 8, 171; from memory",
    example { "O=C1OC(CI)CC1Cc1ccccc1", from = { "C=CCC(C(=O)O)Cc1ccccc1" } },
    example { "O=C1CCC(CI)O1", from = { "C=CCCC(=O)O" } },
    refuse { "O=C1OCC(I)C1" }, -- iodine must sit on the exocyclic carbon (5-exo)
}

interconversion "omega-bromo-acid-from-lactone" {
    about = "Opening of a lactone with hydrogen bromide; alkyl-oxygen cleavage at the primary carbon",
    target = "[Br;X1][C;X4;H2:1][C;X4:2][C;X4:3][C;X3:4](=[O;X1:5])[O;X2;H1:6]",
    from = "[C;X4;H2:1]1[C;X4:2][C;X4:3][C;X3:4](=[O;X1:5])[O;X2;H0:6]1",
    conditions = "acid-aq-strong",
    also_attacks = { "free alcohol", "ether", "alkene" },
    recipe = "HBr (33 % in AcOH), 50-80 °C; also: SOCl2, MeOH for the chloro ester",
    yield = { 75, 92 },
    cautions = { "hydrobromic acid" },
    source = "Larock, Comprehensive Organic Transformations; from memory",
    example { "BrCCC(C)C(=O)O", from = { "CC1CCOC1=O" } },
    example { "BrCCCC(=O)O", from = { "O=C1CCCO1" } },
    refuse { "BrCCC(=O)O" }, -- beta-lactone would be needed
}

interconversion "beckmann-acyclic" {
    about = "Acyclic Beckmann rearrangement; the group anti to the OH migrates with retention (aryl in aryl methyl oximes)",
    rxno = "RXNO:0000631",
    target = "[C;X4:2][C;X3:1](=[O;X1])[N;X3;H1:3]-!@[c:4]",
    from = "[C;X4:2]/[C;X3:1](=[N;X2;H0:3]\\[O;H1])[c:4]",
    conditions = "acid-aq-strong",
    also_attacks = { "free alcohol", "primary amine", "secondary amine" },
    recipe = "SOCl2 or POCl3, or TsCl, base; also: cyanuric chloride; H2SO4",
    yield = { 70, 92 },
    cautions = { "thionyl chloride", "4-toluenesulfonyl chloride", "phosphorus oxychloride" },
    source = "Kürti and Czakó, Strategic Applications of Named Reactions in Organic Synthesis; from memory",
    example { "CC(=O)Nc1ccc(O)cc1", from = { "C/C(=N\\O)c1ccc(O)cc1" } },
    example { "CC(=O)Nc1ccccc1", from = { "C/C(=N\\O)c1ccccc1" } },
    refuse { "CNC(=O)c1ccccc1" }, -- the group anti to OH migrates; here that would be methyl
}

disconnection "pinner-imidate" {
    about = "Pinner reaction; isolated as the hydrochloride; water gives the ester",
    rxno = "RXNO:0000361",
    target = "[#6:1][C;X3:2](=[N;X2;H1:3])-!@[O;X2:4][C;X4;H2,H3:5]",
    from = "[#6:1][C;X2:2]#[N;X1;H0:3].[O;X2;H1:4][C;X4:5]",
    conditions = "acid-hot-dry",
    also_attacks = { "alkene" },
    recipe = "HCl (g), dry EtOH, 0 °C",
    yield = { 75, 95 },
    cautions = { "hydrochloric acid" },
    source = "Kürti and Czakó, Strategic Applications of Named Reactions in Organic Synthesis; from memory",
    example { "CCOC(=N)c1ccc(Cl)cc1", from = { "N#Cc1ccc(Cl)cc1", "CCO" } },
    example { "CCOC(=N)c1ccccc1", from = { "N#Cc1ccccc1", "CCO" } },
    refuse { "CCOC(=NC)c1ccccc1" }, -- N-substituted imidate comes from an amide
}

disconnection "amidine-from-nitrile" {
    about = "Amidine from a nitrile; tautomers: drawn with C=NH; isolated as the hydrochloride",
    target = "[#6:1][C;X3:2](=[N;X2;H1:3])[N;X3;H2:4]",
    from = "[#6:1][C;X2:2]#[N;X1;H0:3].[N;X3;H3:4]",
    conditions = "amine-rt",
    also_attacks = { "ester", "ketone", "alkyl halide", "epoxide" },
    recipe = "HCl, EtOH, then NH3, EtOH; also: LiN(SiMe3)2, THF, then H3O+",
    yield = { 65, 90 },
    cautions = { "hydrochloric acid", "ammonia" },
    source = "March's Advanced Organic Chemistry; from memory",
    example { "COc1ccc(cc1)C(N)=N", from = { "COc1ccc(cc1)C#N", "N" } },
    example { "N=C(N)c1ccccc1", from = { "N#Cc1ccccc1", "N" } },
    refuse { "CN(C)C(=N)N" }, -- guanidine: the central carbon bears no carbon
}

disconnection "amidoxime-from-nitrile" {
    about = "Amidoxime from a nitrile; Z-oxime",
    target = "[#6:1][C;X3:2](=[N;X2:3][O;H1:4])[N;X3;H2:5]",
    from = "[#6:1][C:2]#[N;H0:5].[N;H2:3][O:4]",
    conditions = "base-aq-mild",
    also_attacks = { "aldehyde", "ketone", "epoxide" },
    recipe = "NH2OH·HCl, iPr2NEt or Na2CO3, EtOH, 60-80 °C",
    yield = { 75, 95 },
    cautions = { "hydroxylamine hydrochloride" },
    source = "Joule and Mills, Heterocyclic Chemistry; from memory",
    example { "NC(=NO)c1ccc(cc1)C(=O)OC", from = { "COC(=O)c1ccc(C#N)cc1", "NO" } },
    example { "NC(=NO)c1ccccc1", from = { "N#Cc1ccccc1", "NO" } },
    refuse { "CC(=NO)N(C)C" }, -- disubstituted nitrogen
}

interconversion "thioamide-from-amide" {
    about = "Thionation of an amide; amide before ester",
    target = "[#6:1][C;X3:2](=[S;X1])[N;X3:3]",
    from = "[#6:1][C:2](=O)[N:3]",
    conditions = "heat-200",
    also_attacks = { "ketone", "aldehyde", "free alcohol", "free acid", "other amide" },
    recipe = "Lawesson's reagent, THF or toluene, 60-110 °C; also: P4S10, pyridine",
    yield = { 70, 92 },
    cautions = { "phosphorus pentasulfide" },
    source = "Larock, Comprehensive Organic Transformations; from memory",
    example { "S=C1CN=C(c2ccccc2)c2cc(Cl)ccc2N1", from = { "O=C1CN=C(c2ccccc2)c2cc(Cl)ccc2N1" } },
    example { "CN(C)C(=S)c1ccccc1", from = { "CN(C)C(=O)c1ccccc1" } },
    refuse { "CC(=S)SC" }, -- a dithioester
}

interconversion "thioamide-from-nitrile" {
    about = "Primary thioamide from a nitrile",
    target = "[#6:1][C;X3:2](=[S;X1])[N;X3;H2:3]",
    from = "[#6:1][C:2]#[N;H0:3]",
    conditions = "thiolate",
    also_attacks = { "nitro", "azide", "aldehyde" },
    recipe = "(NH4)2S or H2S/Et3N, pyridine, 50 °C; also: P4S10/EtOH, thioacetamide/HCl, NaSH/MgCl2 in DMF",
    yield = { 75, 92 },
    cautions = { "hydrogen sulfide", "pyridine", "triethylamine" },
    source = "Kleemann and Engel, Pharmaceutical Substances; from memory",
    example { "NC(=S)c1ccnc(c1)CC", from = { "CCc1nccc(C#N)c1" } },
    example { "NC(=S)c1ccccc1", from = { "N#Cc1ccccc1" } },
    refuse { "CNC(C)=S" }, -- substituted nitrogen
}

disconnection "gramine-cyanide" {
    about = "Indol-3-ylacetonitrile from a gramine; amine lost by elimination-addition",
    target = "[c;$(c1c[nX3]c2ccccc12):1][C;X4;H2:2]-[C;X2;+0:3]#[N:4]",
    from = "[c:1][C:2]N(C)C.[C;-:3]#[N:4].[K+]",
    conditions = "cyanide",
    also_attacks = { "alkyl halide", "aldehyde", "acyl halide", "epoxide" },
    recipe = "KCN, DMF/H2O, reflux; also: gramine methiodide, NaCN",
    yield = { 60, 88 },
    cautions = { "potassium cyanide", "N,N-dimethylformamide" },
    source = "Joule and Mills, Heterocyclic Chemistry; from memory",
    example { "COc1ccc2[nH]cc(CC#N)c2c1", from = { "COc1ccc2[nH]cc(CN(C)C)c2c1", "[K+].[C-]#N" } },
    example { "N#CCc1c[nH]c2ccccc12", from = { "CN(C)Cc1c[nH]c2ccccc12", "[K+].[C-]#N" } },
    refuse { "N#CCc1ccccc1" }, -- benzyl: no elimination to an azafulvene
}

interconversion "terminal-alkene-to-acid" {
    about = "Oxidative cleavage of a terminal alkene to an acid (alkene oxidative cleavage); one carbon lost",
    rxno = "RXNO:0000344",
    target = "[C;X4;H2:1][C;X3:2](=[O;X1])[O;H1]",
    from = "[C:1][C;H1:2]=[C;H2]",
    conditions = "kmno4",
    also_attacks = { "benzyl ether", "electron-rich arene" },
    recipe = "RuCl3 (cat.), NaIO4, CCl4/MeCN/H2O; also: KMnO4/NaIO4, O3 then H2O2",
    yield = { 70, 90 },
    cautions = { "ruthenium tetroxide", "carbon tetrachloride" },
    source = "Carey and Sundberg, Advanced Organic Chemistry, Part B; from memory",
    example { "CC(C)(C)OC(=O)N1CCC(CC1)CC(=O)O", from = { "CC(C)(C)OC(=O)N1CCC(CC1)CC=C" } },
    example { "CCCCCCCCCC(=O)O", from = { "C=CCCCCCCCCC" } },
    refuse { "OC(=O)O" }, -- no carbon on the acid
}

interconversion "glutaric-anhydride" {
    about = "Six-membered cyclic anhydride from a glutaric acid",
    target = "[CX3;r6:1]1(=[OX1:2])[OX2:3][CX3;r6:4](=[OX1:5])[CX4:6][CX4:7][CX4:8]1",
    from = "[C:1](=[O:2])([O:3])[C:8][C:7][C:6][C:4](=[O:5])O",
    conditions = "acylation",
    also_attacks = { "alcohol", "phenol", "primary amine", "secondary amine", "thiol" },
    recipe = "Ac2O, reflux; also: AcCl; dicyclohexylcarbodiimide",
    yield = { 85, 97 },
    cautions = { "acetic anhydride" },
    source = "Vogel's Textbook of Practical Organic Chemistry; from memory",
    example { "O=C1CC2(CCCCC2)CC(=O)O1", from = { "OC(=O)CC1(CC(=O)O)CCCCC1" } },
    example { "O=C1CCCC(=O)O1", from = { "OC(=O)CCCC(=O)O" } },
    refuse { "O=C1CCC(=O)O1" }, -- a succinic anhydride
}

interconversion "acyl-lactam-hydrolysis" {
    about = "4-Amino ketone by hydrolysis and decarboxylation of a 3-acyl-2-pyrrolidinone",
    target = "[#6;c,CX4:1][CX3:2](=[OX1:3])[CX4;H2:4][CX4;H2:5][CX4;H2:6][NX3;H1,H2:7]",
    from = "[#6:1][C:2](=[O:3])[C:4]1C(=O)[N:7][C:6][C:5]1",
    conditions = "acid-aq-strong",
    also_attacks = { "ester", "nitrile", "acetal", "Boc carbamate", "tert-butyl ester" },
    recipe = "conc. HCl, reflux (CO2 leaves)",
    yield = { 70, 90 },
    cautions = { "hydrochloric acid" },
    source = "Späth, Bretschneider, Ber. Dtsch. Chem. Ges. 1928, 61, 327; from memory",
    example { "O=C(CCCNC)c1cccnc1", from = { "CN1CCC(C1=O)C(=O)c1cccnc1" } },
    example { "O=C(CCCNC)c1ccccc1", from = { "CN1CCC(C1=O)C(=O)c1ccccc1" } },
    refuse { "CC(=O)CCNC" }, -- one carbon fewer
}

disconnection "quaternary-nitrile-alcoholysis" {
    about = "Ester from a nitrile on a fully substituted benzylic carbon and an alcohol",
    target = "[CX4;H0;$(C-c):1][CX3:2](=[OX1])-!@[OX2:3][CX4;H2,H3:4]",
    from = "[C:1][C:2]#N.[O:3][C:4]",
    conditions = "acid-aq-strong",
    also_attacks = { "acetal", "Boc carbamate", "tert-butyl ester", "silyl ether", "other nitrile" },
    recipe = "H2SO4 or HCl, the alcohol, 100-130 °C, long",
    yield = { 60, 82 },
    cautions = { "sulfuric acid" },
    source = "Kleemann and Engel, Pharmaceutical Substances; from memory",
    example { "CCOC(=O)C1(CCN(C)CC1)c1ccccc1", from = { "N#CC1(CCN(C)CC1)c1ccccc1", "CCO" } },
    example { "COC(=O)C1(CCCC1)c1ccccc1", from = { "N#CC1(CCCC1)c1ccccc1", "CO" } },
    refuse { "CCOC(=O)C(C)(C)C" }, -- no aryl group
}

disconnection "arylacetonitrile-secondary-alkylation" {
    about = "Alkylation of an arylacetonitrile with isopropyl bromide",
    target = "[CX4;H1,H0:1]([c:2])([CX2:3]#[NX1:4])-!@[CX4;H1:5]([CH3:6])[CH3:7]",
    cut = { 5, 1 },
    acceptor = { 5, "secondary-halide" },
    donor = { 1, "stabilised-carbanion" },
    conditions = "base-hindered",
    also_attacks = { "free acid", "alcohol", "other alkyl halide", "aldehyde", "ketone", "ester" },
    recipe = "NaNH2 or NaH, toluene or DMF; also: 50 % NaOH, Bu4NHSO4",
    yield = { 65, 88 },
    cautions = { "sodium hydride" },
    source = "Kleemann and Engel, Pharmaceutical Substances; from memory",
    example { "COc1ccc(cc1OC)C(C#N)C(C)C", from = { "COc1ccc(CC#N)cc1OC", "CC(C)Br" } },
    example { "CC(C)C(C#N)c1ccccc1", from = { "N#CCc1ccccc1", "CC(C)Br" } },
    refuse { "CC(C)C(C#N)C" }, -- no aryl group
}

interconversion "azlactone-to-amino-acid" {
    about = "Amino acid from an azlactone by reduction and hydrolysis with hydrogen iodide and phosphorus",
    target = "[NX3;H2:1][CX4;H1:2]([CX4;H2:3][c:4])[CX3:5](=[OX1:6])[OX2H]",
    from = "[N:1]1=C(c2ccccc2)O[C:5](=[O:6])[C:2]1=[C:3][c:4]",
    conditions = "acid-aq-strong",
    also_attacks = { "aryl methyl ether", "nitro", "alkene", "acetal", "ester" },
    recipe = "red P, HI, Ac2O or AcOH, reflux; racemic; aryl methyl ethers are cleaved",
    yield = { 60, 80 },
    cautions = { "hydriodic acid", "phosphorus" },
    source = "Gillespie, Snyder, Org. Synth. Coll. Vol. 2, 489; from memory",
    example { "NC(Cc1ccccc1)C(=O)O", from = { "O=C1OC(c2ccccc2)=NC1=Cc1ccccc1" } },
    example { "NC(Cc1ccc(F)cc1)C(=O)O", from = { "O=C1OC(c2ccccc2)=NC1=Cc1ccc(F)cc1" } },
    refuse { "NC(C)C(=O)O" }, -- no arylmethyl group
}
