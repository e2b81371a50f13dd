-- Acyl groups moved between carbon, nitrogen and oxygen.
-- Yields are typical ranges and sources stand from memory unless a source says otherwise.

pack {
    name = "acyl-transfer",
    version = "0.1.0",
    licence = "CC0-1.0",
    about = "Acyl groups moved between carbon, nitrogen and oxygen",
    needs = { "synthons" },
}

disconnection "amide-from-ethyl-ester" {
    about = "Ammonolysis or aminolysis of an ethyl ester; chiral α carbon is kept under mild conditions",
    target = "[#6;!$([CX4;H0]);!$([CX4]-[NX3;H1,H2;+0;!$(N-[C,S]=[O,S,N]);!$(N-c)]):1][C;X3:2](=[O;X1:3])-!@[N;X3;$([H2]),$([H1]-[CX4;H2,H3]),$([H1]-[CX4;R]);!$(N-[CX4]-C(=O)[OX2H1]);!$(N[#7,#8]);!$(N-c);!$(N(-C=O)-[C,S]=O):4]",
    cut = { 2, 4 },
    acceptor = { 2, "acyl-ethyl-ester" },
    donor = { 4, "amine" },
    conditions = "amine-heat",
    also_attacks = { "amidine", "thiourea", "other ester", "acyl halide", "anhydride", "epoxide", "alkyl halide", "aldehyde" },
    recipe = "conc. aq. NH3 or amine, EtOH, rt to 80 °C; also: methyl ester, NH3/MeOH in a pressure tube",
    yield = { 70, 92 },
    cautions = { "ammonia" },
    source = "Vogel's Textbook of Practical Organic Chemistry; from memory",
    example { "NC(=O)c1cnc(s1)-c1ccc(F)cc1", from = { "CCOC(=O)c1cnc(s1)-c1ccc(F)cc1", "N" } },
    example { "NC(=O)c1ccncc1", from = { "CCOC(=O)c1ccncc1", "N" } },
    refuse { "CC(=O)Nc1ccccc1" }, -- anilines are too weak for unactivated esters
}

disconnection "hydrazide-from-ethyl-ester" {
    about = "Hydrazinolysis of an ethyl ester; nitro and aryl halide survive at 80 °C",
    target = "[#6:1][C;X3:2](=[O;X1:3])[N;X3;H1:4][N;X3;H2:5]",
    cut = { 2, 4 },
    acceptor = { 2, "acyl-ethyl-ester" },
    donor = { 4, "amine" },
    conditions = "hydrazine",
    also_attacks = { "other ester", "aldehyde", "ketone", "acyl halide", "imide", "alkyl halide", "anhydride",
        "lactone" },
    recipe = "N2H4·H2O, EtOH, reflux; also: methyl ester",
    yield = { 75, 92 },
    cautions = { "hydrazine" },
    source = "Vogel's Textbook of Practical Organic Chemistry; from memory",
    example { "NNC(=O)Cc1c[nH]c2ccc(F)cc12", from = { "CCOC(=O)Cc1c[nH]c2ccc(F)cc12", "NN" } },
    example { "NNC(=O)c1ccncc1", from = { "CCOC(=O)c1ccncc1", "NN" } },
    refuse { "CN(N)C(=O)c1ccccc1" }, -- N-methyl hydrazide needs methylhydrazine
}

disconnection "acetamide-from-anhydride" {
    about = "N-Acetylation of an alkylamine with acetic anhydride (N-acylation to amide); amine before phenol and alcohol",
    rxno = "RXNO:0000357",
    target = "[C;X4:1][N;X3;!$(N(-C=O)-[C,S]=O);!$(N-[N,O]):2]-!@[C;X3:3](=[O:4])[C;H3:5]",
    cut = { 3, 2 },
    acceptor = { 3, "acetyl" },
    donor = { 2, "amine" },
    conditions = "acylation",
    also_attacks = { "primary amine", "secondary amine", "free alcohol", "phenol", "thiol" },
    recipe = "Ac2O, Et3N, CH2Cl2, 0 °C to rt; also: AcCl, aq. NaOH",
    yield = { 85, 97 },
    cautions = { "acetic anhydride", "triethylamine" },
    source = "Vogel's Textbook of Practical Organic Chemistry; from memory",
    example { "COc1ccc2[nH]cc(CCNC(C)=O)c2c1", from = { "COc1ccc2[nH]cc(CCN)c2c1", "CC(=O)OC(C)=O" } },
    example { "CC(=O)NCc1ccccc1", from = { "NCc1ccccc1", "CC(=O)OC(C)=O" } },
    refuse { "CC(=O)OCc1ccccc1" }, -- an ester oxygen, not an amide nitrogen
}

disconnection "oxazolidinone-n-acylation" {
    about = "N-Acylation of an oxazolidinone (Evans auxiliary); auxiliary keeps its configuration",
    rxno = "RXNO:0000357",
    target = "[N;$(N1C(=O)OCC1):1]-!@[C;X3:2](=[O:3])[#6:4]",
    cut = { 2, 1 },
    acceptor = { 2, "acyl" },
    donor = { 1, "amide-nitrogen" },
    conditions = "organolithium",
    also_attacks = { "free alcohol", "free acid", "primary amine", "secondary amine", "ketone", "aldehyde",
        "other ester" },
    recipe = "nBuLi, THF, -78 °C, then RCOCl; also: mixed pivalic anhydride with LiCl/Et3N",
    yield = { 80, 95 },
    cautions = { "butyllithium" },
    source = "Carey and Sundberg, Advanced Organic Chemistry, Part B; from memory",
    example { "O=C(CCc1ccc(F)cc1)N1C(=O)OC[C@@H]1Cc1ccccc1", from = { "O=C1N[C@@H](Cc2ccccc2)CO1", "O=C(Cl)CCc1ccc(F)cc1" } },
    example { "CCC(=O)N1CCOC1=O", from = { "O=C1NCCO1", "CCC(=O)Cl" } },
    refuse { "O=C1OCCN1c1ccccc1" }, -- N-aryl: no acyl group
}

disconnection "indole-n-acylation" {
    about = "N-Acylation of an indole; nitrogen of the sodium salt, C3 without base",
    rxno = "RXNO:0000357",
    target = "[n;r5;X3:1]-!@[C;X3:2](=[O:3])[#6:4]",
    cut = { 2, 1 },
    acceptor = { 2, "acyl" },
    donor = { 1, "azole" },
    when = function(m) return not m.molecule:has "[$([CX3](=O)[OX2H]),$([OX2H][CX4]),$([OX2H]c)]" end,
    conditions = "base-hindered",
    also_attacks = { "primary amine", "secondary amine", "free alcohol", "phenol", "thiol", "free acid" },
    recipe = "NaH, DMF, 0 °C, then RCOCl; also: NaOH, Bu4NHSO4, CH2Cl2",
    yield = { 65, 90 },
    cautions = { "sodium hydride", "N,N-dimethylformamide" },
    source = "Kleemann and Engel, Pharmaceutical Substances; from memory",
    example { "COc1ccc2n(C(=O)c3ccc(Cl)cc3)c(C)c(CC(=O)OC(C)(C)C)c2c1", from = { "COc1ccc2[nH]c(C)c(CC(=O)OC(C)(C)C)c2c1", "O=C(Cl)c1ccc(Cl)cc1" } },
    example { "CC(=O)n1ccc2ccccc21", from = { "c1ccc2[nH]ccc2c1", "CC(=O)Cl" } },
    refuse { "CC(=O)c1c[nH]c2ccccc12" }, -- a C-acyl indole
}

disconnection "sulfonylurea-isocyanate" {
    about = "Sulfonylurea from a sulfonamide and an isocyanate; sulfonamide nitrogen of the anion",
    rxno = "RXNO:0000358",
    target = "[S;X4:1](=[O:2])(=[O:3])[N;X3;H1:4]-!@[C;X3:5](=[O:6])-!@[N;X3;H1:7][#6:8]",
    cut = { 5, 4 },
    acceptor = { 5, "carbamoyl" },
    donor = { 4, "sulfonamide-nitrogen" },
    conditions = "base-aq-mild",
    also_attacks = { "primary amine", "secondary amine", "free alcohol", "phenol", "thiol" },
    recipe = "K2CO3, acetone, reflux; also: NaOH, CuCl/DMF",
    yield = { 70, 90 },
    cautions = { "isocyanates" },
    source = "Kleemann and Engel, Pharmaceutical Substances; from memory",
    example { "COc1ccc(Cl)cc1C(=O)NCCc1ccc(cc1)S(=O)(=O)NC(=O)NC1CCCCC1", from = { "COc1ccc(Cl)cc1C(=O)NCCc1ccc(cc1)S(N)(=O)=O", "O=C=NC1CCCCC1" } },
    example { "CCCCNC(=O)NS(=O)(=O)c1ccc(C)cc1", from = { "Cc1ccc(cc1)S(N)(=O)=O", "CCCCN=C=O" } },
    refuse { "CS(=O)(=O)NC(=O)N(C)C" }, -- second nitrogen carries no H
}

disconnection "sulfonyl-carbamate" {
    about = "Ethyl sulfonylcarbamate from a sulfonamide; no isomers to expect",
    rxno = "RXNO:0000359",
    target = "[S;X4:1](=[O:2])(=[O:3])[N;X3;H1:4]-!@[C;X3:5](=[O:6])[O:7][C;H2:8][C;H3:9]",
    cut = { 5, 4 },
    acceptor = { 5, "alkoxycarbonyl" },
    donor = { 4, "sulfonamide-nitrogen" },
    conditions = "acylation",
    also_attacks = { "primary amine", "secondary amine", "free alcohol", "phenol", "thiol" },
    recipe = "K2CO3, acetone, reflux",
    yield = { 75, 92 },
    cautions = { "ethyl chloroformate" },
    source = "Kleemann and Engel, Pharmaceutical Substances; from memory",
    example { "CCOC(=O)NS(=O)(=O)c1ccc(C)cc1", from = { "Cc1ccc(cc1)S(N)(=O)=O", "CCOC(=O)Cl" } },
    example { "CCOC(=O)NS(=O)(=O)c1ccc(Cl)cc1", from = { "NS(=O)(=O)c1ccc(Cl)cc1", "CCOC(=O)Cl" } },
    refuse { "CCOC(=O)NCS(C)(=O)=O" }, -- nitrogen not on the sulfur
}

disconnection "sulfonylurea-from-carbamate" {
    about = "Sulfonylurea from a sulfonylcarbamate and an amine; no isomers to expect",
    rxno = "RXNO:0000358",
    target = "[S;X4:1](=[O:2])(=[O:3])[N;X3;H1:4][C;X3:5](=[O:6])-!@[N;X3:7]",
    cut = { 5, 7 },
    acceptor = { 5, "acyl-ethyl-ester" },
    donor = { 7, "amine" },
    conditions = "amine-heat",
    also_attacks = { "other activated ester", "acyl halide", "primary amine" },
    recipe = "toluene, reflux, ethanol distilled off",
    yield = { 75, 92 },
    source = "Kleemann and Engel, Pharmaceutical Substances; from memory",
    example { "Cc1ccc(cc1)S(=O)(=O)NC(=O)NN1CC2CCCC2C1", from = { "CCOC(=O)NS(=O)(=O)c1ccc(C)cc1", "NN1CC2CCCC2C1" } },
    example { "CCCNC(=O)NS(=O)(=O)c1ccc(Cl)cc1", from = { "CCOC(=O)NS(=O)(=O)c1ccc(Cl)cc1", "CCCN" } },
    refuse { "CS(=O)(=O)NC(C)=O" }, -- an acyl sulfonamide
}

disconnection "carbamate-from-isocyanate" {
    about = "Carbamate from an isocyanate and an alcohol; no isomers to expect",
    rxno = "RXNO:0000359",
    target = "[#6:1][N;X3;H1:2]-!@[C;X3:3](=[O:4])-!@[O;X2:5][C;X4:6]",
    cut = { 3, 5 },
    acceptor = { 3, "carbamoyl" },
    donor = { 5, "alcohol" },
    conditions = "amine-rt",
    also_attacks = { "primary amine", "secondary amine", "phenol", "thiol", "free acid", "other alcohol" },
    recipe = "Et3N or dibutyltin dilaurate, toluene, 60-90 °C",
    yield = { 80, 95 },
    cautions = { "isocyanates", "triethylamine" },
    source = "Larock, Comprehensive Organic Transformations; from memory",
    example { "CC(C)OC(=O)Nc1cccc(Cl)c1", from = { "CC(C)O", "O=C=Nc1cccc(Cl)c1" } },
    example { "CCOC(=O)Nc1ccccc1", from = { "CCO", "O=C=Nc1ccccc1" } },
    refuse { "CCOC(=O)N(C)C" }, -- no N-H
}

disconnection "thiourea-from-isothiocyanate" {
    about = "Thiourea from an isothiocyanate and an amine; no isomers to expect",
    target = "[#6:1][N;X3;H1:2]-!@[C;X3:3](=[S;X1:4])-!@[N;X3:5]",
    from = "[#6:1][N;H0:2]=[C:3]=[S:4].[N:5]",
    conditions = "amine-rt",
    also_attacks = { "other primary amine", "secondary amine", "thiol", "hydrazine" },
    recipe = "EtOH or CH2Cl2, rt; NH3 for the mono-substituted thiourea",
    yield = { 80, 97 },
    cautions = { "isothiocyanates" },
    source = "Vogel's Textbook of Practical Organic Chemistry; from memory",
    example { "COC(=O)c1ccc(NC(=S)NCC2CCCO2)cc1", from = { "COC(=O)c1ccc(cc1)N=C=S", "NCC1CCCO1" } },
    example { "S=C(NCc1ccccc1)Nc1ccccc1", from = { "S=C=Nc1ccccc1", "NCc1ccccc1" } },
    refuse { "CN(C)C(=S)N(C)C" }, -- no N-H
}

disconnection "half-ester-from-cyclic-anhydride" {
    about = "Opening of a cyclic anhydride by an alcohol; cis; racemic, or enantioselective with a cinchona alkaloid",
    target = "[O;X2;H1:1][C;X3:2](=[O;X1:3])[#6:4]~[#6:5][C;X3:6](=[O;X1:7])-!@[O;X2:8][C;X4:9]",
    from = "[O;H0:1]1[C:2](=[O:3])[#6:4]~[#6:5][C:6]1=[O:7].[O;H1:8][C:9]",
    conditions = "acylation",
    also_attacks = { "primary amine", "secondary amine", "free alcohol", "phenol", "thiol" },
    recipe = "MeOH, reflux; also: other primary alcohols, DMAP",
    yield = { 75, 95 },
    source = "Vogel's Textbook of Practical Organic Chemistry; from memory",
    example { "COC(=O)C1CC=CCC1C(=O)O", from = { "O=C1OC(=O)C2CC=CCC12", "CO" } },
    example { "COC(=O)c1ccccc1C(=O)O", from = { "O=C1OC(=O)c2ccccc12", "CO" } },
    refuse { "COC(=O)CC(=O)O" }, -- malonic half-ester: the four-membered anhydride is not available
}

disconnection "malonate-c-acylation" {
    about = "C-Acylation of a malonic ester; C- over O-acylation with magnesium",
    target = "[#6:1][C;X3:2](=[O:3])-!@[C;X4;H1:4]([C;X3:5](=[O:6])[O:7][C:8])[C;X3:9](=[O:10])[O:11][C:12]",
    cut = { 2, 4 },
    acceptor = { 2, "acyl" },
    donor = { 4, "stabilised-carbanion" },
    conditions = "acylation",
    also_attacks = { "primary amine", "secondary amine", "free alcohol", "phenol", "thiol" },
    recipe = "MgCl2, Et3N, MeCN, 0 °C, then RCOCl; also: Mg(OEt)2",
    yield = { 75, 92 },
    cautions = { "triethylamine" },
    source = "Carey and Sundberg, Advanced Organic Chemistry, Part B; from memory",
    example { "CCOC(=O)C(C(=O)OCC)C(=O)c1cc(F)c(F)cc1Cl", from = { "O=C(Cl)c1cc(F)c(F)cc1Cl", "CCOC(=O)CC(=O)OCC" } },
    example { "CCOC(=O)C(C(=O)OCC)C(=O)c1ccccc1", from = { "O=C(Cl)c1ccccc1", "CCOC(=O)CC(=O)OCC" } },
    refuse { "CCOC(=O)C(C)(C(C)=O)C(=O)OCC" }, -- no H left on the central carbon
}

disconnection "meldrum-acylation" {
    about = "Acylation of Meldrum's acid; written as the enol",
    target = "[#6:1][C;X3:2]([O;H1:3])=[C:4]1[C](=O)O[C]([C;H3])([C;H3])O[C]1=O",
    from = "[#6:1][C:2](=[O;H0:3])Cl.[C;H2:4]1C(=O)OC(C)(C)OC1=O",
    conditions = "acylation",
    also_attacks = { "primary amine", "secondary amine", "free alcohol", "phenol", "thiol" },
    recipe = "pyridine or DMAP, CH2Cl2, 0 °C; also: acid with DCC or pivaloyl chloride",
    yield = { 80, 95 },
    cautions = { "pyridine", "4-dimethylaminopyridine" },
    source = "Larock, Comprehensive Organic Transformations; from memory",
    example { "CC1(C)OC(=O)C(=C(O)Cc2cc(F)c(F)cc2F)C(=O)O1", from = { "O=C(Cl)Cc1cc(F)c(F)cc1F", "CC1(C)OC(=O)CC(=O)O1" } },
    example { "CCC(O)=C1C(=O)OC(C)(C)OC1=O", from = { "CCC(=O)Cl", "CC1(C)OC(=O)CC(=O)O1" } },
    refuse { "CC1(C)OC(=O)C(=Cc2ccccc2)C(=O)O1" }, -- an arylidene: Knoevenagel
}

disconnection "meldrum-alcoholysis" {
    about = "β-Keto ester by alcoholysis of an acyl Meldrum's acid; loses CO2 and acetone",
    target = "[#6:1][C;X3:2](=[O:3])[C;X4;H2:4][C;X3:5](=[O:6])[O;X2:7][C;X4:8]",
    from = "[#6:1][C:2]([O;H1:3])=[C;H0:4]1[C:5](=[O:6])OC(C)(C)OC1=O.[O;H1:7][C:8]",
    conditions = "heat-200",
    also_attacks = { "primary amine", "secondary amine", "other alcohol" },
    recipe = "MeOH, reflux; also: tBuOH or other alcohol in toluene reflux",
    yield = { 80, 95 },
    source = "Larock, Comprehensive Organic Transformations; from memory",
    example { "COC(=O)CC(=O)Cc1cc(F)c(F)cc1F", from = { "CC1(C)OC(=O)C(=C(O)Cc2cc(F)c(F)cc2F)C(=O)O1", "CO" } },
    example { "CCOC(=O)CC(=O)CC", from = { "CCC(O)=C1C(=O)OC(C)(C)OC1=O", "CCO" } },
    refuse { "COC(=O)C(C)C(C)=O" }, -- substituted between the carbonyl groups
}

disconnection "baker-venkataraman" {
    about = "Baker-Venkataraman rearrangement; intramolecular acyl transfer",
    rxno = "RXNO:0000122",
    target = "[O;H1:1][c:2]:[c:3][C;X3:4](=[O:5])[C;X4;H2:6]-!@[C;X3:7](=[O:8])[#6:9]",
    from = "[O;H0:1]([C:7](=[O:8])[#6:9])[c:2]:[c:3][C:4](=[O:5])[C;H3:6]",
    conditions = "base-aq-strong",
    also_attacks = { "other ester", "alkyl halide", "aldehyde" },
    recipe = "KOH, pyridine, 50 °C; also: KOtBu, NaH in DMSO",
    yield = { 70, 90 },
    cautions = { "pyridine", "potassium hydroxide" },
    source = "Kürti and Czakó, Strategic Applications of Named Reactions in Organic Synthesis; from memory",
    example { "COc1ccc(cc1)C(=O)CC(=O)c1ccccc1O", from = { "COc1ccc(cc1)C(=O)Oc1ccccc1C(C)=O" } },
    example { "O=C(CC(=O)c1ccccc1O)c1ccccc1", from = { "CC(=O)c1ccccc1OC(=O)c1ccccc1" } },
    refuse { "O=C(CC(=O)c1ccccc1)c1ccccc1" }, -- no ortho hydroxyl group
}

disconnection "formamide-formation" {
    about = "Formylation of an amine with formic acid; amine before alcohol",
    rxno = "RXNO:0000357",
    target = "[N;X3;!$(N(-C=O)-[C,S]=O):1]-!@[C;X3;H1:2]=[O:3]",
    cut = { 2, 1 },
    acceptor = { 2, "acyl-acid" },
    donor = { 1, "amine" },
    conditions = "amine-heat",
    also_attacks = { "tertiary alcohol", "acetal", "Boc carbamate", "other primary amine" },
    recipe = "HCO2H, toluene, reflux with water removal; also: ethyl formate reflux, acetic formic anhydride",
    yield = { 80, 97 },
    cautions = { "formic acid" },
    source = "Vogel's Textbook of Practical Organic Chemistry; from memory",
    example { "O=CNc1cccc(Cl)c1C", from = { "Nc1cccc(Cl)c1C", "OC=O" } },
    example { "O=CNc1ccccc1", from = { "Nc1ccccc1", "OC=O" } },
    refuse { "CN(C)C(C)=O" }, -- an acetamide
}

disconnection "meldrum-acylation-keto" {
    about = "Acylation of Meldrum's acid; written as the ketone",
    target = "[#6:1][CX3:2](=[OX1:3])[CX4;H1:4]1C(=O)OC([CH3])([CH3])OC1=O",
    from = "[#6:1][C:2](=[O:3])Cl.[C:4]1C(=O)OC(C)(C)OC1=O",
    conditions = "acylation",
    also_attacks = { "primary amine", "secondary amine", "free alcohol", "phenol", "thiol" },
    recipe = "pyridine (2 equiv.), CH2Cl2, 0 °C",
    yield = { 80, 95 },
    cautions = { "pyridine" },
    source = "Oikawa, Sugano, Yonemitsu, J. Org. Chem. 1978, 43, 2087; from memory",
    example { "CCCC(=O)C1C(=O)OC(C)(C)OC1=O", from = { "CCCC(=O)Cl", "CC1(C)OC(=O)CC(=O)O1" } },
    example { "O=C(Cc1ccccc1)C1C(=O)OC(C)(C)OC1=O", from = { "O=C(Cl)Cc1ccccc1", "CC1(C)OC(=O)CC(=O)O1" } },
    refuse { "CC(=O)C1C(=O)CCCC1=O" }, -- a carbocycle
}

disconnection "meldrum-alcoholysis-keto" {
    about = "β-Keto ester by alcoholysis of an acyl Meldrum's acid written as the ketone; loses CO2 and acetone",
    target = "[#6:1][CX3:2](=[OX1:3])[CX4;H2:4][CX3:5](=[OX1:6])[OX2:7][CX4:8]",
    from = "[#6:1][C:2](=[O:3])[C:4]1[C:5](=[O:6])OC(C)(C)OC1=O.[O:7][C:8]",
    conditions = "acid-hot-dry",
    also_attacks = { "primary amine", "secondary amine", "other alcohol" },
    recipe = "the alcohol as solvent, reflux 2 h; or 1-3 equiv. in toluene, reflux",
    yield = { 70, 92 },
    source = "Oikawa, Sugano, Yonemitsu, J. Org. Chem. 1978, 43, 2087; from memory",
    example { "CCCC(=O)CC(=O)OCC", from = { "CCCC(=O)C1C(=O)OC(C)(C)OC1=O", "CCO" } },
    example { "COC(=O)CC(=O)Cc1ccccc1", from = { "O=C(Cc1ccccc1)C1C(=O)OC(C)(C)OC1=O", "CO" } },
    refuse { "COC(=O)C(C)C(C)=O" }, -- substituted between the carbonyl groups
}

disconnection "glutaric-anhydride-amine" {
    about = "Opening of a glutaric anhydride by ammonia or an amine; less hindered carbonyl reacts in " ..
        "unsymmetrical anhydrides",
    target = "[O;X2;H1:1][C;X3:2](=[O;X1:3])[C;X4:4][C;X4:5][C;X4:6][C;X3:7](=[O;X1:8])-!@[N;X3:9]",
    from = "[O;H0:1]1[C:2](=[O:3])[C:4][C:5][C:6][C:7]1=[O:8].[N:9]",
    conditions = "acylation",
    also_attacks = { "primary amine", "secondary amine", "free alcohol", "phenol", "thiol" },
    recipe = "conc. aq. NH3, 0-20 °C, then acid; also: primary and secondary amines in CH2Cl2 or toluene",
    yield = { 80, 95 },
    cautions = { "ammonia" },
    source = "Kleemann and Engel, Pharmaceutical Substances; from memory",
    example { "NC(=O)CC1(CC(=O)O)CCCCC1", from = { "O=C1CC2(CCCCC2)CC(=O)O1", "N" } },
    example { "O=C(O)CCCC(=O)Nc1ccccc1", from = { "O=C1CCCC(=O)O1", "Nc1ccccc1" } },
    refuse { "NC(=O)CCCCC(=O)O" }, -- adipic anhydride is a polymer
}

disconnection "glutaric-anhydride-alcohol" {
    about = "Opening of a glutaric anhydride by an alcohol; racemic, or enantioselective with a cinchona " ..
        "alkaloid",
    target = "[O;X2;H1:1][C;X3:2](=[O;X1:3])[C;X4:4][C;X4:5][C;X4:6][C;X3:7](=[O;X1:8])-!@[O;X2:9][C;X4:10]",
    from = "[O;H0:1]1[C:2](=[O:3])[C:4][C:5][C:6][C:7]1=[O:8].[O;H1:9][C:10]",
    conditions = "amine-rt",
    also_attacks = { "primary amine", "secondary amine", "free alcohol", "phenol", "thiol" },
    recipe = "MeOH, reflux; also: NaOMe",
    yield = { 75, 92 },
    source = "Vogel's Textbook of Practical Organic Chemistry; from memory",
    example { "COC(=O)CC(CC(=O)O)c1ccc(Cl)cc1", from = { "O=C1CC(CC(=O)O1)c1ccc(Cl)cc1", "CO" } },
    example { "COC(=O)CCCC(=O)O", from = { "O=C1CCCC(=O)O1", "CO" } },
    refuse { "COC(=O)CCCCC(=O)O" }, -- adipic anhydride is a polymer
}

disconnection "trifluoroacetamide" {
    about = "Trifluoroacetylation of an amine (N-acylation to amide); removed again by K2CO3 in MeOH",
    rxno = "RXNO:0000357",
    target = "[N;X3;!$(N(-C(=O)C(F)(F)F)-[C,S]=O);!$(N-[N,O]):1]-!@[C;X3:2](=[O:3])[C:4]([F:5])([F:6])[F:7]",
    cut = { 2, 1 },
    acceptor = { 2, "trifluoroacetyl" },
    donor = { 1, "amine" },
    conditions = "acylation",
    also_attacks = { "primary amine", "secondary amine", "free alcohol", "phenol", "thiol" },
    recipe = "(CF3CO)2O, Et3N, CH2Cl2, 0 °C; also: CF3CO2Et, MeOH",
    yield = { 85, 97 },
    cautions = { "trifluoroacetic anhydride", "triethylamine" },
    source = "Wuts, Greene's Protective Groups in Organic Synthesis; from memory",
    example { "O=C(NCCc1ccc(Br)cc1)C(F)(F)F", from = { "NCCc1ccc(Br)cc1", "O=C(OC(=O)C(F)(F)F)C(F)(F)F" } },
    example { "O=C(Nc1ccccc1)C(F)(F)F", from = { "Nc1ccccc1", "O=C(OC(=O)C(F)(F)F)C(F)(F)F" } },
    refuse { "NC(=O)C(F)F" }, -- only two fluorine atoms
}

disconnection "lactam-n-acylation" {
    about = "N-Acylation of a lactam (N-acylation to amide)",
    rxno = "RXNO:0000357",
    target = "[N;R;$(N1C(=O)CCC1),$(N1C(=O)CCCC1);!$(N1C(=O)CCC1=O);!$(N1C(=O)CCCC1=O):1]-!@[C;X3:2](=[O:3])[#6:4]",
    cut = { 2, 1 },
    acceptor = { 2, "acyl" },
    donor = { 1, "amide-nitrogen" },
    conditions = "base-hindered",
    also_attacks = { "free alcohol", "primary amine", "secondary amine", "phenol", "thiol", "free acid" },
    recipe = "NaH or nBuLi, THF, -78 °C to rt, then RCOCl; also: Et3N/DMAP, anhydride",
    yield = { 65, 88 },
    cautions = { "sodium hydride", "butyllithium" },
    source = "Larock, Comprehensive Organic Transformations; from memory",
    example { "COc1ccc(cc1)C(=O)N1CCCC1=O", from = { "O=C1CCCN1", "COc1ccc(cc1)C(=O)Cl" } },
    example { "CC(=O)N1CCCCC1=O", from = { "O=C1CCCCN1", "CC(=O)Cl" } },
    refuse { "CN1CCCC1=O" }, -- no acyl group on nitrogen
}

disconnection "azole-boc" {
    about = "N-Boc protection of an indole, pyrrole or azole; less hindered nitrogen of an azole",
    target = "[n;r5;X3:1]-!@[C;X3:2](=[O:3])[O:4][C:5]([C;H3:6])([C;H3:7])[C;H3:8]",
    cut = { 2, 1 },
    acceptor = { 2, "tert-butoxycarbonyl" },
    donor = { 1, "azole" },
    conditions = "acylation",
    also_attacks = { "primary amine", "secondary amine", "free alcohol", "phenol", "thiol" },
    recipe = "Boc2O, DMAP, MeCN, rt",
    yield = { 88, 98 },
    cautions = { "di-tert-butyl dicarbonate", "4-dimethylaminopyridine" },
    source = "Wuts, Greene's Protective Groups in Organic Synthesis; from memory",
    example { "CC(C)(C)OC(=O)n1cc(C=O)c2ccccc12", from = { "O=Cc1c[nH]c2ccccc12", "CC(C)(C)OC(=O)OC(=O)OC(C)(C)C" } },
    example { "CC(C)(C)OC(=O)n1cccc1", from = { "c1cc[nH]c1", "CC(C)(C)OC(=O)OC(=O)OC(C)(C)C" } },
    refuse { "CC(C)(C)OC(=O)N1CCCC1" }, -- saturated amine: ordinary Boc protection
}

disconnection "indole-n-sulfonylation" {
    about = "N-Sulfonylation of an indole or pyrrole",
    target = "[n;r5;X3:1]-!@[S;X4:2](=[O:3])(=[O:4])[c:5]",
    cut = { 2, 1 },
    acceptor = { 2, "sulfonyl" },
    donor = { 1, "azole" },
    conditions = "base-hindered",
    also_attacks = { "primary amine", "secondary amine", "free alcohol", "phenol", "thiol", "free acid" },
    recipe = "NaH, DMF, 0 °C, then ArSO2Cl; also: NaOH, Bu4NHSO4, CH2Cl2",
    yield = { 80, 95 },
    cautions = { "benzenesulfonyl chloride", "sodium hydride", "N,N-dimethylformamide" },
    source = "Wuts, Greene's Protective Groups in Organic Synthesis; from memory",
    example { "O=Cc1cn(S(=O)(=O)c2ccccc2)c2cc(F)ccc12", from = { "O=Cc1c[nH]c2cc(F)ccc12", "O=S(=O)(Cl)c1ccccc1" } },
    example { "Cc1ccc(cc1)S(=O)(=O)n1cccc1", from = { "c1cc[nH]c1", "Cc1ccc(cc1)S(=O)(=O)Cl" } },
    refuse { "O=S(=O)(Nc1ccccc1)c1ccccc1" }, -- an anilide nitrogen
}

disconnection "phenyl-carbamate" {
    about = "Aryl carbamate from an amine and an aryl chloroformate (N-acylation to carbamate)",
    rxno = "RXNO:0000359",
    target = "[N;X3;!$(N(-C=O)-[C,S]=O):1]-!@[C;X3:2](=[O:3])-!@[O;X2:4][c:5]",
    cut = { 2, 1 },
    acceptor = { 2, "alkoxycarbonyl" },
    donor = { 1, "amine" },
    conditions = "acylation",
    also_attacks = { "primary amine", "secondary amine", "free alcohol", "phenol", "thiol" },
    recipe = "PhOC(O)Cl, pyridine, CH2Cl2, 0 °C; also: 4-nitrophenyl chloroformate",
    yield = { 80, 95 },
    cautions = { "phenyl chloroformate", "pyridine" },
    source = "Larock, Comprehensive Organic Transformations; from memory",
    example { "O=C(Nc1cc(on1)C(C)(C)C)Oc1ccccc1", from = { "Nc1cc(on1)C(C)(C)C", "O=C(Cl)Oc1ccccc1" } },
    example { "O=C(Nc1ccccc1)Oc1ccccc1", from = { "Nc1ccccc1", "O=C(Cl)Oc1ccccc1" } },
    refuse { "CNC(=O)OC" }, -- alkyl carbamate
}

disconnection "urea-from-phenyl-carbamate" {
    about = "Urea from an aryl carbamate and an amine (N-acylation to urea); unsymmetrical ureas without " ..
        "isocyanates",
    rxno = "RXNO:0000358",
    target = "[#6:6][N;X3;H1;!$(N-[S,N,O]);!$(N(-C=O)-[C,S]=O):1]-!@[C;X3:2](=[O:3])-!@[N;X3;!$(N(-C=O)-[C,S]=O);!$(N-[S,N,O]):4]",
    cut = { 2, 4 },
    acceptor = { 2, "acyl-phenyl-ester" },
    donor = { 4, "amine" },
    conditions = "amine-rt",
    also_attacks = { "other activated ester", "acyl halide", "primary amine", "isocyanate" },
    recipe = "amine, Et3N or iPr2NEt, DMSO or MeCN, 25-60 °C",
    yield = { 75, 92 },
    cautions = { "dimethyl sulfoxide", "triethylamine" },
    source = "Larock, Comprehensive Organic Transformations; from memory",
    example { "O=C(Nc1cccnc1)N1CCC(CC1)c1ccc(Cl)cc1", from = { "O=C(Nc1cccnc1)Oc1ccccc1", "Clc1ccc(cc1)C1CCNCC1" } },
    example { "O=C(Nc1ccccc1)N1CCOCC1", from = { "O=C(Nc1ccccc1)Oc1ccccc1", "C1COCCN1" } },
    refuse { "CN(C)C(=O)N(C)C" }, -- no N-H: no free carbamate N-H
}

disconnection "urea-cdi" {
    about = "Urea from two amines and 1,1'-carbonyldiimidazole (N-acylation to urea); primary amine first, " ..
        "then the second amine",
    rxno = "RXNO:0000358",
    target = "[#6:5][N;X3;H1;!$(N-[S,N,O]);!$(N(-C=O)-[C,S]=O):1]-!@[C;X3:2](=[O:3])-!@[N;X3;!$(N(-C=O)-[C,S]=O);!$(N-[S,N,O]):4]",
    from = "[#6:5][N:1].[N:4].[C:2](=[O:3])(n1ccnc1)n1ccnc1",
    conditions = "amine-rt",
    also_attacks = { "thiol", "free acid", "free alcohol", "other primary amine", "phenol" },
    recipe = "CDI, CH2Cl2 or THF, 0 °C, then second amine; also: triphosgene, 4-nitrophenyl chloroformate",
    yield = { 65, 88 },
    source = "Larock, Comprehensive Organic Transformations; from memory",
    example { "COc1ccc(CNC(=O)N2CCCC2C(=O)OC)cc1", from = { "COc1ccc(CN)cc1", "COC(=O)C1CCCN1", "O=C(n1ccnc1)n1ccnc1" } },
    example { "O=C(NCc1ccccc1)N1CCCCC1", from = { "NCc1ccccc1", "C1CCCCN1", "O=C(n1ccnc1)n1ccnc1" } },
    refuse { "CN(C)C(=O)N(C)C" }, -- two secondary amines: too slow with CDI
}

disconnection "isothiocyanate-from-amine" {
    about = "Isothiocyanate from a primary amine",
    target = "[#6:1][N;X2:2]=[C;X2:3]=[S:4]",
    from = "[#6:1][N;H2:2].[C:3](=[S:4])=S",
    conditions = "acylation",
    also_attacks = { "primary amine", "secondary amine", "free alcohol", "phenol", "thiol", "alkyl halide" },
    recipe = "CS2, Et3N, then Boc2O or TsCl; also: thiophosgene, aq. NaHCO3; thiocarbonyldiimidazole",
    yield = { 75, 92 },
    cautions = { "carbon disulfide", "4-toluenesulfonyl chloride", "triethylamine" },
    source = "Larock, Comprehensive Organic Transformations; from memory",
    example { "S=C=Nc1ccc(C#N)c(c1)C(F)(F)F", from = { "Nc1ccc(C#N)c(c1)C(F)(F)F", "S=C=S" } },
    example { "S=C=Nc1ccccc1", from = { "Nc1ccccc1", "S=C=S" } },
    refuse { "CSC#N" }, -- a thiocyanate
}

disconnection "acyl-cyanide" {
    about = "Acyl cyanide from an acid chloride",
    target = "[#6:1][C;X3:2](=[O:3])-[C;X2:4]#[N:5]",
    cut = { 2, 4 },
    acceptor = { 2, "acyl" },
    donor = { 4, "copper-cyanide" },
    conditions = "cyanide",
    also_attacks = { "primary amine", "secondary amine", "free alcohol", "phenol", "thiol" },
    recipe = "CuCN, KI, xylene or MeCN, reflux; also: TMSCN, KCN with phase transfer",
    yield = { 60, 85 },
    cautions = { "copper(I) cyanide" },
    source = "Kleemann and Engel, Pharmaceutical Substances; from memory",
    example { "N#CC(=O)c1cccc(Cl)c1Cl", from = { "O=C(Cl)c1cccc(Cl)c1Cl", "N#C[Cu]" } },
    example { "N#CC(=O)c1ccccc1", from = { "O=C(Cl)c1ccccc1", "N#C[Cu]" } },
    refuse { "N#CCC(=O)c1ccccc1" }, -- the cyano group is one carbon further
}

disconnection "keto-ester-from-malonate-half-ester" {
    about = "β-Keto ester from an acid chloride and a malonic half-ester; loses CO2",
    target = "[#6:1][C;X3:2](=[O:3])-!@[C;X4;H2:4][C;X3:5](=[O:6])[O;X2:7][C:8]",
    from = "[#6:1][C:2](=[O:3])Cl.[C:4](C(=O)O)[C:5](=[O:6])[O:7][C:8]",
    conditions = "acylation",
    also_attacks = { "primary amine", "secondary amine", "free alcohol", "phenol", "thiol" },
    recipe = "potassium ethyl malonate, MgCl2, Et3N, MeCN or EtOAc, then aq. HCl; also: acyl imidazole (CDI)",
    yield = { 75, 92 },
    cautions = { "hydrochloric acid", "triethylamine" },
    source = "Carey and Sundberg, Advanced Organic Chemistry, Part B; from memory",
    example { "CCOC(=O)CC(=O)c1cc(F)c(Cl)nc1Cl", from = { "O=C(Cl)c1cc(F)c(Cl)nc1Cl", "CCOC(=O)CC(=O)O" } },
    example { "CCOC(=O)CC(=O)c1ccccc1", from = { "O=C(Cl)c1ccccc1", "CCOC(=O)CC(=O)O" } },
    refuse { "CCOC(=O)C(C)C(C)=O" }, -- substituted between the carbonyl groups
}

disconnection "cyano-ketone-claisen" {
    about = "β-Keto nitrile from an ester and acetonitrile; non-enolisable ester",
    rxno = "RXNO:0000043",
    target = "[#6;c,$([CX4](C)(C)C):1][C;X3:2](=[O:3])-!@[C;X4;H2:4][C;X2:5]#[N:6]",
    cut = { 2, 4 },
    acceptor = { 2, "acyl-methyl-ester" },
    donor = { 4, "stabilised-carbanion" },
    conditions = "alkoxide",
    also_attacks = { "aldehyde", "ketone", "free alcohol", "free acid", "alkyl halide", "primary amide" },
    recipe = "NaH, THF or toluene, 80 °C; also: KOtBu, nBuLi at -78 °C",
    yield = { 70, 90 },
    cautions = { "acetonitrile", "sodium hydride" },
    source = "Larock, Comprehensive Organic Transformations; from memory",
    example { "N#CCC(=O)c1ccc2OCOc2c1", from = { "COC(=O)c1ccc2OCOc2c1", "CC#N" } },
    example { "N#CCC(=O)c1ccccc1", from = { "COC(=O)c1ccccc1", "CC#N" } },
    refuse { "N#CC(=O)c1ccccc1" }, -- an acyl cyanide
}

disconnection "arylacetonitrile-acylation" {
    about = "Acylation of an arylacetonitrile by an ester; isolated as the enol salt",
    rxno = "RXNO:0000043",
    target = "[#6:1][C;X3:2](=[O:3])-!@[C;X4;H1:4]([c:7])[C;X2:5]#[N:6]",
    cut = { 2, 4 },
    acceptor = { 2, "acyl-ethyl-ester" },
    donor = { 4, "stabilised-carbanion" },
    conditions = "alkoxide",
    also_attacks = { "aldehyde", "ketone", "alkyl halide", "other ester" },
    recipe = "NaOEt, EtOH, reflux; also: KOtBu/THF, NaH",
    yield = { 65, 88 },
    source = "Vogel's Textbook of Practical Organic Chemistry; from memory",
    example { "CCC(=O)C(C#N)c1ccc(Cl)cc1", from = { "CCC(=O)OCC", "N#CCc1ccc(Cl)cc1" } },
    example { "CC(=O)C(C#N)c1ccccc1", from = { "CCOC(C)=O", "N#CCc1ccccc1" } },
    refuse { "CC(=O)CC#N" }, -- no aryl group to acidify the nitrile
}

disconnection "oxalate-claisen" {
    about = "Acylation of a ketone by diethyl oxalate; methyl before methylene; exists as the enol",
    rxno = "RXNO:0000043",
    target = "[#6:1][C;X3:2](=[O:3])[C;X4;H1,H2:4]-!@[C;X3:5](=[O:6])[C;X3:7](=[O:8])[O:9][C:10]",
    cut = { 5, 4 },
    acceptor = { 5, "acyl-ethyl-ester" },
    donor = { 4, "enolate" },
    conditions = "alkoxide",
    also_attacks = { "aldehyde", "other ketone", "alkyl halide", "acyl halide" },
    recipe = "NaOEt, EtOH, 0 °C to rt; also: LiHMDS, Et2O",
    yield = { 75, 92 },
    source = "Joule and Mills, Heterocyclic Chemistry; from memory",
    example { "CCOC(=O)C(=O)CC(=O)c1ccc(S(C)(=O)=O)cc1", from = { "CC(=O)c1ccc(S(C)(=O)=O)cc1", "CCOC(=O)C(=O)OCC" } },
    example { "CCOC(=O)C(=O)CC(=O)c1ccccc1", from = { "CC(=O)c1ccccc1", "CCOC(=O)C(=O)OCC" } },
    refuse { "CCOC(=O)CC(C)=O" }, -- no second carbonyl next to the ester
}

disconnection "ketone-formylation" {
    about = "Formylation of a ketone by ethyl formate; exists as the hydroxymethylene ketone",
    rxno = "RXNO:0000043",
    target = "[#6:1][C;X3:2](=[O:3])[C;X4;H1:4]([#6:7])-!@[C;X3;H1:5]=[O:6]",
    cut = { 5, 4 },
    acceptor = { 5, "acyl-ethyl-ester" },
    donor = { 4, "enolate" },
    conditions = "alkoxide",
    also_attacks = { "aldehyde", "other ketone", "alkyl halide" },
    recipe = "NaOEt or NaH, Et2O or toluene, 0 °C to rt",
    yield = { 65, 90 },
    cautions = { "sodium hydride" },
    source = "Vogel's Textbook of Practical Organic Chemistry; from memory",
    example { "CC(C)(C)OC(=O)N1CCC(=O)C(C=O)C1", from = { "CC(C)(C)OC(=O)N1CCC(=O)CC1", "CCOC=O" } },
    example { "O=CC1CCCCC1=O", from = { "O=C1CCCCC1", "CCOC=O" } },
    refuse { "CC(=O)C(C)(C)C=O" }, -- no H left on the carbon
}

disconnection "formate-ester" {
    about = "Formate ester from an alcohol; configuration kept",
    rxno = "RXNO:0000360",
    target = "[C;X4;!$(C([#8])[#7,#8]):1][O;X2:2]-!@[C;X3;H1:3]=[O:4]",
    cut = { 3, 2 },
    acceptor = { 3, "acyl-acid" },
    donor = { 2, "alcohol" },
    conditions = "acid-hot-dry",
    also_attacks = { "tertiary alcohol", "acetal", "silyl ether", "primary amine" },
    recipe = "HCO2H, 60 °C; also: acetic formic anhydride, pyridine",
    yield = { 80, 95 },
    cautions = { "formic acid" },
    source = "Wuts, Greene's Protective Groups in Organic Synthesis; from memory",
    example { "CC1CCC(C(C)C)C(C1)OC=O", from = { "CC1CCC(C(C)C)C(C1)O", "OC=O" } },
    example { "O=COCCc1ccccc1", from = { "OCCc1ccccc1", "OC=O" } },
    refuse { "CC(=O)OC1CCCCC1" }, -- an acetate
}

disconnection "hydrazide-acylation" {
    about = "Diacylhydrazine from a hydrazide and an acid chloride",
    rxno = "RXNO:0000357",
    target = "[#6:8][C;X3:1](=[O:2])[N;X3;H1:3][N;X3;H1:4]-!@[C;X3:5](=[O:6])[#6:7]",
    cut = { 5, 4 },
    acceptor = { 5, "acyl" },
    donor = { 4, "amine" },
    conditions = "acylation",
    also_attacks = { "primary amine", "secondary amine", "free alcohol", "phenol", "thiol" },
    recipe = "pyridine or Et3N, CH2Cl2, 0 °C; also: acid with EDC or T3P",
    yield = { 80, 95 },
    cautions = { "pyridine", "triethylamine" },
    source = "Joule and Mills, Heterocyclic Chemistry; from memory",
    example { "COc1ccc(cc1)C(=O)NNC(=O)c1ccncc1", from = { "NNC(=O)c1ccncc1", "COc1ccc(cc1)C(=O)Cl" } },
    example { "O=C(NNC(=O)c1ccccc1)c1ccccc1", from = { "NNC(=O)c1ccccc1", "O=C(Cl)c1ccccc1" } },
    refuse { "CC(=O)NN(C)C" }, -- only one acyl group
}
