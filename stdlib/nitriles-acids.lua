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
    target = "[#6:1][C;X3:2](=[O;X1:3])-!@[N;X3;!$(N(C=O)[C,S]=[O,S,N]);!$(N[#7,#8]):4]",
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
    refuse { "CNC(=O)OC" }, -- carbamate: no carbon on the acyl side
}

disconnection "schotten-baumann" {
    about = "Schotten-Baumann reaction; amine before alcohol and water",
    rxno = "RXNO:0000165",
    target = "[#6:1][C;X3:2](=[O;X1:3])-!@[N;X3;!$(N(C=O)[C,S]=[O,S,N]);!$(N[#7,#8]):4]",
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
    refuse { "CN(C)C(=O)N(C)C" }, -- urea: no carbon on the acyl side
}

disconnection "ester-aminolysis" {
    about = "Aminolysis of a methyl ester; primary alkylamines and ammonia; slow with hindered partners",
    target = "[#6:1][C;X3:2](=[O;X1:3])-!@[N;X3;H1,H2;!$(N[#7,#8]);!$(Nc):4]",
    cut = { 2, 4 },
    acceptor = { 2, "acyl-methyl-ester" },
    donor = { 4, "amine" },
    conditions = "amine-heat",
    also_attacks = { "ester", "acyl halide", "anhydride", "epoxide", "alkyl halide", "aldehyde" },
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
