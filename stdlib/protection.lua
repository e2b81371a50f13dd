-- Protecting groups on and off.
-- Yields are typical ranges and sources stand from memory unless a source says otherwise.

pack {
    name = "protection",
    version = "0.1.0",
    licence = "CC0-1.0",
    about = "Protecting groups on and off",
    needs = { "synthons" },
}

interconversion "boc-protection" {
    about = "Boc protection; survives base, nucleophiles, hydride (mild), hydrogenation; removed by acid",
    rxno = "RXNO:0000079",
    target = "[N;X3;+0;!$(N(C=O)[C,S]=[O,S,N]);!$(N[#7,#8,#16]):1][C;X3:2](=[O;X1:3])[O;X2:4][C;X4:5]([C;H3:6])([C;H3:7])[C;H3:8]",
    from = "[N;X3:1].[C;X3:2](=[O;X1:3])([O;X2:4][C;X4:5]([C;H3:6])([C;H3:7])[C;H3:8])[O;X2]C(=O)OC(C)(C)C",
    conditions = "acylation",
    also_attacks = { "primary amine", "secondary amine", "thiol" },
    recipe = "Boc2O, NaHCO3 or Et3N, THF-H2O or CH2Cl2, 0 °C to rt; DMAP for weak nucleophiles",
    yield = { 85, 99 },
    cautions = { "di-tert-butyl dicarbonate", "4-dimethylaminopyridine" },
    source = "Wuts, Greene's Protective Groups in Organic Synthesis; from memory",
    example { "COC(=O)[C@H](Cc1ccc(O)cc1)NC(=O)OC(C)(C)C", from = { "COC(=O)[C@@H](N)Cc1ccc(O)cc1", "CC(C)(C)OC(=O)OC(=O)OC(C)(C)C" } },
    refuse { "CNC(=O)OCC" }, -- ethyl carbamate
}

interconversion "boc-removal" {
    about = "Boc deprotection; methyl ester, benzyl ether, Cbz, Fmoc, nitrile survive; tert-butyl ester does not",
    rxno = "RXNO:0000326",
    target = "[N;X3;H1,H2;!$(N[C,S]=[O,S,N]);!$(N[#7,#8,#16]);!$(N[C;X3]=[C;X3]);!$(N(c)c):1]",
    from = "[N;X3:1][C;X3](=[O;X1])[O;X2][C;X4]([C;H3])([C;H3])[C;H3]",
    conditions = "acid-aq-mild",
    also_attacks = { "tert-butyl ester", "trityl ether", "acetal", "silyl ether", "THP ether", "MOM ether",
        "epoxide", "enol ether", "tertiary alcohol" },
    recipe = "CF3CO2H, CH2Cl2, 0 °C to rt; also: HCl, dioxane or MeOH",
    yield = { 90, 99 },
    cautions = { "trifluoroacetic acid" },
    source = "Wuts, Greene's Protective Groups in Organic Synthesis; from memory",
    example { "COC(=O)C1CCNCC1", from = { "COC(=O)C1CCN(CC1)C(=O)OC(C)(C)C" } },
    refuse { "CC(=O)N" }, -- amide nitrogen: no free amine is released
}

interconversion "cbz-protection" {
    about = "Benzyloxycarbonyl (Cbz) protection of an amine; survives TFA, mild base, mild hydride; removed by hydrogenolysis or HBr",
    rxno = "RXNO:0000321",
    target = "[N;X3;+0;!$(N(C=O)[C,S]=[O,S,N]);!$(N[#7,#8,#16]):1][C;X3:2](=[O;X1:3])[O;X2:4][C;X4;H2:5][c:6]1[c;H1:7][c;H1:8][c;H1:9][c;H1:10][c;H1:11]1",
    from = "[N;X3:1].[C;X3:2](=[O;X1:3])([Cl;X1])[O;X2:4][C;X4;H2:5][c:6]1[c;H1:7][c;H1:8][c;H1:9][c;H1:10][c;H1:11]1",
    conditions = "acylation",
    also_attacks = { "primary amine", "secondary amine", "thiol", "phenol" },
    recipe = "CbzCl, NaHCO3 or Na2CO3, H2O-THF, 0 °C",
    yield = { 85, 98 },
    cautions = { "benzyl chloroformate" },
    source = "Wuts, Greene's Protective Groups in Organic Synthesis; from memory",
    example { "O=C(O)[C@@H]1CCCN1C(=O)OCc1ccccc1", from = { "O=C(O)[C@@H]1CCCN1", "O=C(Cl)OCc1ccccc1" } },
    refuse { "CNC(=O)OC(C)(C)C" }, -- tert-butyl carbamate
}

interconversion "cbz-removal" {
    about = "Hydrogenolysis of a Cbz group (amino group deprotection); Boc, tert-butyl ester, methyl ester, acetal survive",
    rxno = "RXNO:0000320",
    target = "[N;X3;H1,H2;!$(N[C,S]=[O,S,N]);!$(N[#7,#8,#16]);!$(N[C;X3]=[C;X3]);!$(N(c)c):1]",
    from = "[N;X3:1][C;X3](=[O;X1])[O;X2][C;X4;H2]c1ccccc1",
    conditions = "h2-pd",
    also_attacks = { "alkene", "alkyne", "nitro", "azide", "imine", "aryl halide", "benzyl ether",
        "benzyl ester", "thiol", "thioether" },
    recipe = "H2, Pd/C, MeOH or EtOH, rt; also: HBr, AcOH; TMSI",
    yield = { 88, 99 },
    cautions = { "hydrogen" },
    source = "Wuts, Greene's Protective Groups in Organic Synthesis; from memory",
    example { "CC(C)(C)OC(=O)N1CCNCC1", from = { "CC(C)(C)OC(=O)N1CCN(CC1)C(=O)OCc1ccccc1" } },
    refuse { "CC(=O)N" }, -- amide nitrogen
}

interconversion "benzyl-ether-protection" {
    about = "Benzyl ether protection; survives acid, base, hydride, fluoride; removed by hydrogenolysis",
    rxno = "RXNO:0000324",
    target = "[C;X4;!$(C([#8])[#7,#8,#16]):1][O;X2:2]-!@[C;X4;H2:3][c:4]1[c;H1:5][c;H1:6][c;H1:7][c;H1:8][c;H1:9]1",
    from = "[C;X4:1][O;X2;H1:2].[C;X4;H2:3]([Br;X1])[c:4]1[c;H1:5][c;H1:6][c;H1:7][c;H1:8][c;H1:9]1",
    conditions = "alkylation",
    also_attacks = { "free alcohol", "phenol", "free acid", "thiol", "primary amine", "secondary amine",
        "ester", "primary amide" },
    recipe = "NaH, BnBr, DMF or THF, Bu4NI (cat), 0 °C to rt; also: BnOC(NH)CCl3, acid",
    yield = { 80, 96 },
    cautions = { "sodium hydride", "benzyl bromide", "N,N-dimethylformamide" },
    source = "Wuts, Greene's Protective Groups in Organic Synthesis; from memory",
    example { "C(OCC1COC(C)(C)O1)c1ccccc1", from = { "OCC1COC(C)(C)O1", "BrCc1ccccc1" } },
    refuse { "c1ccccc1OCc1ccccc1" }, -- aryl benzyl ether: phenol rule
}

interconversion "benzyl-ether-removal" {
    about = "Hydrogenolysis of a benzyl ether (hydroxy group deprotection); Boc, silyl ether, acetal, ester survive",
    rxno = "RXNO:0000430",
    target = "[C;X4;!$(C([#8])[#7,#8,#16]):1][O;X2;H1:2]",
    from = "[C;X4:1][O;X2;H0:2][C;X4;H2]c1ccccc1",
    conditions = "h2-pd",
    also_attacks = { "alkene", "alkyne", "nitro", "azide", "imine", "aryl halide", "benzyl ester",
        "Cbz amine", "thiol", "thioether" },
    recipe = "H2, Pd/C or Pd(OH)2/C, EtOH, rt; also: Na, NH3; BCl3; BBr3",
    yield = { 85, 98 },
    cautions = { "hydrogen" },
    source = "Wuts, Greene's Protective Groups in Organic Synthesis; from memory",
    example { "OC[C@H]1CCCN1C(=O)OC(C)(C)C", from = { "CC(C)(C)OC(=O)N1CCC[C@@H]1COCc1ccccc1" } },
    refuse { "Oc1ccccc1" }, -- phenol: own rule for aryl benzyl ethers
}

disconnection "benzylamine-protection" {
    about = "Benzylamine protection; survives acid, base, hydride, organometallics; removed by hydrogenolysis",
    rxno = "RXNO:0000322",
    target = "[N;X3;!$(N[C,S]=[O,S,N]);!$(N[#7,#8,#16]):1]-!@[C;X4;H2:2][c:3]1[c;H1:4][c;H1:5][c;H1:6][c;H1:7][c;H1:8]1",
    cut = { 2, 1 },
    acceptor = { 2, "alkyl" },
    donor = { 1, "amine" },
    conditions = "alkylation",
    also_attacks = { "primary amine", "secondary amine", "tertiary amine", "thiol", "phenol", "free acid" },
    recipe = "BnBr, K2CO3, MeCN, rt to 60 °C; also: PhCHO, NaBH(OAc)3",
    yield = { 80, 95 },
    cautions = { "benzyl bromide" },
    source = "Wuts, Greene's Protective Groups in Organic Synthesis; from memory",
    example { "CCOC(=O)C1CCN(CC1)Cc1ccccc1", from = { "CCOC(=O)C1CCNCC1", "BrCc1ccccc1" } },
    refuse { "CC(=O)NCc1ccccc1" }, -- amide nitrogen
}

interconversion "benzylamine-removal" {
    about = "Benzylamine deprotection; Boc, ester, silyl ether survive",
    rxno = "RXNO:0000327",
    target = "[N;X3;H1,H2;!$(N[C,S]=[O,S,N]);!$(N[#7,#8,#16]);!$(N[C;X3]=[C;X3]);!$(N(c)c):1]",
    from = "[N;X3:1][C;X4;H2]c1ccccc1",
    conditions = "h2-pd",
    also_attacks = { "alkene", "alkyne", "nitro", "azide", "imine", "aryl halide", "benzyl ether",
        "benzyl ester", "Cbz amine", "thiol", "thioether" },
    recipe = "H2, Pd(OH)2/C, EtOH, AcOH (cat), 1-4 atm; also: HCO2NH4, Pd/C, reflux; 1-chloroethyl chloroformate then MeOH",
    yield = { 80, 97 },
    cautions = { "hydrogen" },
    source = "Wuts, Greene's Protective Groups in Organic Synthesis; from memory",
    example { "CC(C)(C)OC(=O)NC1CCNC1", from = { "CC(C)(C)OC(=O)NC1CCN(C1)Cc1ccccc1" } },
    refuse { "CC(=O)N" }, -- amide nitrogen: benzyl amides resist hydrogenolysis
}

interconversion "ketone-dioxolane-protection" {
    about = "Dioxolane of a ketone (acetal protection); ketone before ester; enones slower; survives base, hydride, organometallics; removed by acid",
    rxno = "RXNO:0000658",
    target = "[#6:1][C;X4;H0;r5:2]1([#6:3])[O;X2;r5:4][C;H2:5][C;H2:6][O;X2;r5:7]1",
    from = "[#6:1][C;X3;H0:2]([#6:3])=[O;X1].[O;X2;H1:4][C;H2:5][C;H2:6][O;X2;H1:7]",
    conditions = "acid-hot-dry",
    also_attacks = { "aldehyde", "ketone", "free acid", "silyl ether", "tert-butyl ester", "Boc amine",
        "epoxide" },
    recipe = "HOCH2CH2OH, TsOH (cat), toluene, Dean-Stark; also: TMSOCH2CH2OTMS, TMSOTf",
    yield = { 80, 96 },
    source = "Wuts, Greene's Protective Groups in Organic Synthesis; from memory",
    example { "CCOC(=O)CC1(C)OCCO1", from = { "CCOC(=O)CC(C)=O", "OCCO" } },
    refuse { "C1COCCO1" }, -- 1,4-dioxane: no carbon bears both oxygens
}

interconversion "ketone-dioxolane-removal" {
    about = "Hydrolysis of a ketone dioxolane (deprotection); ester, benzyl ether, Cbz survive",
    rxno = "RXNO:0000203",
    target = "[#6:1][C;X3;H0:2]([#6:3])=[O;X1]",
    from = "[#6:1][C;X4;H0:2]1([#6:3])[O;X2][C;H2][C;H2][O;X2]1",
    conditions = "acid-aq-mild",
    also_attacks = { "acetal", "silyl ether", "trityl ether", "THP ether", "enol ether", "epoxide",
        "Boc amine", "tertiary alcohol" },
    recipe = "HCl (2 M), THF or acetone, rt; also: PPTS, acetone-H2O, reflux",
    yield = { 85, 98 },
    cautions = { "hydrochloric acid" },
    source = "Wuts, Greene's Protective Groups in Organic Synthesis; from memory",
    example { "O=C1CCC(CC1)C(=O)OCC", from = { "CCOC(=O)C1CCC2(CC1)OCCO2" } },
    refuse { "CC(=O)OC" }, -- ester carbonyl
}

interconversion "aldehyde-dioxolane-protection" {
    about = "Dioxolane of an aldehyde (acetal protection); aldehyde before ketone; survives base, hydride, organometallics; removed by acid",
    rxno = "RXNO:0000658",
    target = "[#6:1][C;X4;H1;r5:2]1[O;X2;r5:4][C;H2:5][C;H2:6][O;X2;r5:7]1",
    from = "[#6:1][C;X3;H1:2]=[O;X1].[O;X2;H1:4][C;H2:5][C;H2:6][O;X2;H1:7]",
    conditions = "acid-hot-dry",
    also_attacks = { "aldehyde", "ketone", "free acid", "silyl ether", "tert-butyl ester", "Boc amine",
        "epoxide" },
    recipe = "HOCH2CH2OH, TsOH or PPTS (cat), toluene, Dean-Stark",
    yield = { 85, 97 },
    source = "Wuts, Greene's Protective Groups in Organic Synthesis; from memory",
    example { "Brc1ccc(cc1)C1OCCO1", from = { "O=Cc1ccc(Br)cc1", "OCCO" } },
    refuse { "CC1(C)OCCO1" }, -- ketone dioxolane (own rule)
}

interconversion "aldehyde-dioxolane-removal" {
    about = "Hydrolysis of an aldehyde dioxolane (deprotection); ester, benzyl ether, Cbz survive",
    rxno = "RXNO:0000203",
    target = "[#6:1][C;X3;H1:2]=[O;X1]",
    from = "[#6:1][C;X4;H1:2]1[O;X2][C;H2][C;H2][O;X2]1",
    conditions = "acid-aq-mild",
    also_attacks = { "acetal", "silyl ether", "trityl ether", "THP ether", "enol ether", "epoxide",
        "Boc amine", "tertiary alcohol" },
    recipe = "HCl (1 M), THF, rt; also: HCO2H; TsOH, acetone-H2O",
    yield = { 85, 98 },
    cautions = { "hydrochloric acid" },
    source = "Wuts, Greene's Protective Groups in Organic Synthesis; from memory",
    example { "O=Cc1ccc(cc1)C(O)c1ccccn1", from = { "OC(c1ccc(cc1)C1OCCO1)c1ccccn1" } },
    refuse { "CC(C)=O" }, -- ketone
}

interconversion "tbs-protection" {
    about = "TBS ether (silyl protection); survives base, mild hydride, organolithiums, oxidation; removed by fluoride or acid; primary before secondary",
    rxno = "RXNO:0000328",
    target = "[C;X4;!$(C([#8])[#7,#8,#16]):1][O;X2:2][Si;X4:3]([C;H3:4])([C;H3:5])[C;X4;H0:6]([C;H3:7])([C;H3:8])[C;H3:9]",
    from = "[C;X4:1][O;X2;H1:2].[Cl;X1][Si;X4:3]([C;H3:4])([C;H3:5])[C;X4;H0:6]([C;H3:7])([C;H3:8])[C;H3:9]",
    conditions = "silylation",
    also_attacks = { "free alcohol", "phenol", "free acid", "thiol", "primary amine", "secondary amine" },
    recipe = "TBSCl, imidazole, DMF, rt; also: TBSOTf, 2,6-lutidine, CH2Cl2, -78 °C",
    yield = { 88, 99 },
    cautions = { "N,N-dimethylformamide" },
    source = "Wuts, Greene's Protective Groups in Organic Synthesis; from memory",
    example { "COC(=O)[C@@H](C)O[Si](C)(C)C(C)(C)C", from = { "COC(=O)[C@@H](C)O", "CC(C)(C)[Si](C)(C)Cl" } },
    refuse { "CC[Si](CC)(CC)OC" }, -- triethylsilyl ether
}

interconversion "tbs-removal" {
    about = "TBS ether removal (silyl deprotection); benzyl, PMB, acetal, ester, Boc survive fluoride",
    rxno = "RXNO:0000692",
    target = "[C;X4;!$(C([#8])[#7,#8,#16]):1][O;X2;H1:2]",
    from = "[C;X4:1][O;X2;H0:2][Si;X4]([C;H3])([C;H3])[C;X4]([C;H3])([C;H3])[C;H3]",
    conditions = "fluoride",
    also_attacks = { "silyl ether", "Fmoc amine", "alkyl halide", "epoxide" },
    recipe = "Bu4NF, THF, 0 °C to rt; also: HF·pyridine; HCl, MeOH; AcOH-H2O",
    yield = { 88, 99 },
    cautions = { "tetrabutylammonium fluoride" },
    source = "Wuts, Greene's Protective Groups in Organic Synthesis; from memory",
    example { "OCC#Cc1ccc(cc1)C(=O)OC", from = { "COC(=O)c1ccc(cc1)C#CCO[Si](C)(C)C(C)(C)C" } },
    refuse { "Oc1ccccc1" }, -- phenol
}

interconversion "acetate-protection" {
    about = "Acetate protection; survives acid, oxidation, hydrogenation; removed by base or hydride",
    rxno = "RXNO:0000330",
    target = "[C;X4;!$(C([#8])[#7,#8,#16]):1][O;X2:2][C;X3:3](=[O;X1:4])[C;H3:5]",
    from = "[C;X4:1][O;X2;H1:2].[C;X3:3](=[O;X1:4])([C;H3:5])[O;X2]C(C)=O",
    conditions = "acylation",
    also_attacks = { "free alcohol", "phenol", "free acid", "thiol", "primary amine", "secondary amine" },
    recipe = "Ac2O, pyridine, DMAP (cat), rt; also: AcCl, Et3N",
    yield = { 90, 99 },
    cautions = { "acetic anhydride", "pyridine", "4-dimethylaminopyridine" },
    source = "Wuts, Greene's Protective Groups in Organic Synthesis; from memory",
    example { "CC(=O)OCC1=CC[C@@H](CC1)C(C)=C", from = { "OCC1=CC[C@@H](CC1)C(C)=C", "CC(=O)OC(C)=O" } },
    refuse { "CC(=O)Oc1ccccc1" }, -- aryl acetate: phenol rule
}

interconversion "acetate-removal" {
    about = "Removal of an acetate (hydroxy group deprotection); silyl ether, acetal, Boc, benzyl ether, pivalate survive",
    rxno = "RXNO:0000430",
    target = "[C;X4;!$(C([#8])[#7,#8,#16]):1][O;X2;H1:2]",
    from = "[C;X4:1][O;X2;H0:2][C;X3](=[O;X1])[C;H3]",
    conditions = "base-aq-mild",
    also_attacks = { "ester", "acyl halide", "anhydride", "alkyl halide", "epoxide", "imide", "Fmoc amine" },
    recipe = "K2CO3, MeOH, rt; also: NaOMe (cat), MeOH; LiOH; KCN",
    yield = { 90, 99 },
    source = "Wuts, Greene's Protective Groups in Organic Synthesis; from memory",
    example { "OC1CCC(CC1)O[Si](C)(C)C(C)(C)C", from = { "CC(=O)OC1CCC(CC1)O[Si](C)(C)C(C)(C)C" } },
    refuse { "Oc1ccccc1" }, -- phenol
}

interconversion "methyl-ester-removal" {
    about = "Methyl ester deprotection; Boc, tert-butyl ester, benzyl ether, amide survive",
    rxno = "RXNO:0000435",
    target = "[#6:1][C;X3:2](=[O;X1:3])[O;X2;H1:4]",
    from = "[#6:1][C;X3:2](=[O;X1:3])[O;X2;H0:4][C;H3]",
    conditions = "base-aq-mild",
    also_attacks = { "ester", "acyl halide", "anhydride", "alkyl halide", "epoxide", "imide", "Fmoc amine" },
    recipe = "LiOH, THF-MeOH-H2O, rt; also: NaOH; TMSOK; LiI, pyridine, reflux",
    yield = { 88, 99 },
    cautions = { "lithium hydroxide" },
    source = "Wuts, Greene's Protective Groups in Organic Synthesis; from memory",
    example { "OC(=O)C1CCN(CC1)C(=O)OC(C)(C)C", from = { "COC(=O)C1CCN(CC1)C(=O)OC(C)(C)C" } },
    refuse { "CNC(=O)O" }, -- carbamic acid
}

interconversion "ethyl-ester-removal" {
    about = "Ethyl ester deprotection; Boc, tert-butyl ester, benzyl ether, amide survive",
    rxno = "RXNO:0000436",
    target = "[#6:1][C;X3:2](=[O;X1:3])[O;X2;H1:4]",
    from = "[#6:1][C;X3:2](=[O;X1:3])[O;X2;H0:4][C;H2][C;H3]",
    conditions = "base-aq-mild",
    also_attacks = { "ester", "acyl halide", "anhydride", "alkyl halide", "epoxide", "imide", "Fmoc amine" },
    recipe = "NaOH or LiOH, EtOH-H2O, rt to 50 °C",
    yield = { 88, 99 },
    cautions = { "sodium hydroxide", "lithium hydroxide" },
    source = "Wuts, Greene's Protective Groups in Organic Synthesis; from memory",
    example { "OC(=O)c1cnn(C)c1C(F)(F)F", from = { "CCOC(=O)c1cnn(C)c1C(F)(F)F" } },
    refuse { "CNC(=O)O" }, -- carbamic acid
}

interconversion "tert-butyl-ester-removal" {
    about = "tert-Butyl ester deprotection; methyl ester, Cbz, Fmoc, benzyl ether survive; Boc does not",
    rxno = "RXNO:0000434",
    target = "[#6:1][C;X3:2](=[O;X1:3])[O;X2;H1:4]",
    from = "[#6:1][C;X3:2](=[O;X1:3])[O;X2;H0:4][C;X4]([C;H3])([C;H3])[C;H3]",
    conditions = "acid-dry-strong",
    also_attacks = { "Boc amine", "trityl ether", "acetal", "silyl ether", "THP ether", "MOM ether",
        "epoxide", "enol ether", "tertiary alcohol" },
    recipe = "CF3CO2H, CH2Cl2, rt; also: HCl, dioxane; HCO2H",
    yield = { 90, 99 },
    cautions = { "trifluoroacetic acid" },
    source = "Wuts, Greene's Protective Groups in Organic Synthesis; from memory",
    example { "COC(=O)CC[C@H](NC(=O)OCc1ccccc1)C(=O)O", from = { "COC(=O)CC[C@H](NC(=O)OCc1ccccc1)C(=O)OC(C)(C)C" } },
    refuse { "CNC(=O)O" }, -- carbamic acid
}

interconversion "aryl-methyl-ether-cleavage" {
    about = "Cleavage of an aryl methyl ether (hydroxy group deprotection); ketone, ester (cold), nitro, halide survive; ortho-carbonyl methyl ether first with BCl3",
    rxno = "RXNO:0000430",
    target = "[c:1][O;X2;H1:2]",
    from = "[c:1][O;X2;H0:2][C;H3]",
    conditions = "bbr3",
    also_attacks = { "tert-butyl ester", "Boc amine", "trityl ether", "acetal", "silyl ether", "THP ether",
        "MOM ether", "epoxide", "enol ether", "tertiary alcohol", "benzyl ether", "free alcohol" },
    recipe = "BBr3, CH2Cl2, -78 °C to rt; also: BCl3; EtSNa, DMF, heat; HBr (48 %), reflux",
    yield = { 75, 95 },
    cautions = { "boron tribromide" },
    source = "Wuts, Greene's Protective Groups in Organic Synthesis; from memory",
    example { "Oc1ccc(cc1)C1CCCCC1=O", from = { "COc1ccc(cc1)C1CCCCC1=O" } },
    refuse { "OCc1ccccc1" }, -- alcohol, not a phenol
}

interconversion "aryl-benzyl-ether-removal" {
    about = "Hydrogenolysis of an aryl benzyl ether (hydroxy group deprotection); Boc, ester, acetal, silyl ether, aryl methyl ether survive",
    rxno = "RXNO:0000430",
    target = "[c:1][O;X2;H1:2]",
    from = "[c:1][O;X2;H0:2][C;X4;H2]c1ccccc1",
    conditions = "h2-pd",
    also_attacks = { "alkene", "alkyne", "nitro", "azide", "imine", "aryl halide", "benzyl ester",
        "Cbz amine", "thiol", "thioether" },
    recipe = "H2, Pd/C, EtOH or EtOAc, rt; also: BCl3, C6HMe5, -78 °C; CF3CO2H, PhSMe",
    yield = { 88, 99 },
    cautions = { "hydrogen" },
    source = "Wuts, Greene's Protective Groups in Organic Synthesis; from memory",
    example { "COC(=O)[C@H](Cc1ccc(O)cc1)NC(=O)OC(C)(C)C", from = { "COC(=O)[C@H](Cc1ccc(OCc2ccccc2)cc1)NC(=O)OC(C)(C)C" } },
    refuse { "OCc1ccccc1" }, -- alcohol, not a phenol
}
