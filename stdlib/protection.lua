-- Protecting groups on and off.
-- Yields are typical ranges and sources stand from memory unless a source says otherwise.

pack {
    name = "protection",
    version = "0.1.0",
    licence = "CC0-1.0",
    about = "Protecting groups on and off",
    needs = { "synthons", "preferences" },
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
    target = "[N;X3;H1,H2;!$(N[C,S]=[O,S,N]);!$(N[#7,#8,#16]);!$(N[C;X3]=[C;X3]);!$(N(c)c);!$(N-c:[nX2]);!$(N-C=N):1]",
    from = "[N;X3:1][C;X4;H2]c1ccccc1",
    conditions = "h2-pd",
    also_attacks = { "alkene", "alkyne", "nitro", "azide", "imine", "aryl halide", "benzyl ether",
        "benzyl ester", "Cbz amine", "thiol", "thioether" },
    recipe = "H2, Pd(OH)2/C, EtOH, AcOH (cat), 1-4 atm; also: HCO2NH4, Pd/C, reflux; 1-chloroethyl chloroformate then MeOH",
    yield = { 80, 97 },
    cautions = { "hydrogen" },
    source = "Wuts, Greene's Protective Groups in Organic Synthesis; from memory",
    example { "CC(C)(C)OC(=O)NC1CCNC1", from = { "CC(C)(C)OC(=O)NC1CCN(C1)Cc1ccccc1" } },
    refuse { "Nc1ncccn1" }, -- on an azine the nitrogen is no amine
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
    target = "[#6:1][C;X3;H0;!$(C-C(F)F):2]([#6:3])=[O;X1]",
    from = "[#6:1][C;X4;H0:2]1([#6:3])[O;X2][C;H2][C;H2][O;X2]1",
    conditions = "acid-aq-mild",
    also_attacks = { "acetal", "silyl ether", "trityl ether", "THP ether", "enol ether", "epoxide",
        "Boc amine", "tertiary alcohol" },
    recipe = "HCl (2 M), THF or acetone, rt; also: PPTS, acetone-H2O, reflux",
    yield = { 85, 98 },
    cautions = { "hydrochloric acid" },
    source = "Wuts, Greene's Protective Groups in Organic Synthesis; from memory",
    example { "O=C1CCC(CC1)C(=O)OCC", from = { "CCOC(=O)C1CCC2(CC1)OCCO2" } },
    refuse { "CC(=O)C(F)(F)F" }, -- the acetal of a trifluoromethyl ketone stays in acid
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
    prefer = { "less hindered alcohol", carbon = 1 },
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
    target = "[C;X4;!$(C([#8])[#7,#8,#16]);!$([CX4]-[CX4;!H0]-[CX3;!$(C-[O,N])]=[OX1]);!$([CX4]-[CX4]-[NX3;H1,H2;+0;!$(N-[C,S]=[O,S,N]);!$(N-c)]):1][O;X2;H1:2]",
    from = "[C;X4:1][O;X2;H0:2][C;X3](=[O;X1])[C;H3]",
    conditions = "base-aq-mild",
    also_attacks = { "ester", "acyl halide", "anhydride", "alkyl halide", "epoxide", "imide", "Fmoc amine" },
    recipe = "K2CO3, MeOH, rt; also: NaOMe (cat), MeOH; LiOH; KCN",
    yield = { 90, 99 },
    source = "Wuts, Greene's Protective Groups in Organic Synthesis; from memory",
    example { "OC1CCC(CC1)O[Si](C)(C)C(C)(C)C", from = { "CC(=O)OC1CCC(CC1)O[Si](C)(C)C(C)(C)C" } },
    refuse { "CC(=O)CCO" }, -- the acyloxy group beta to a ketone is lost
    refuse { "NCCO" }, -- the acyl group would have gone to the nitrogen
    refuse { "Oc1ccccc1" }, -- phenol
}

interconversion "methyl-ester-removal" {
    about = "Methyl ester deprotection; Boc, tert-butyl ester, benzyl ether, amide survive",
    rxno = "RXNO:0000435",
    target = "[#6;!$([CX4;H0;R]([#6])([#6])[#6]):1][C;X3:2](=[O;X1:3])[O;X2;H1:4]",
    from = "[#6:1][C;X3:2](=[O;X1:3])[O;X2;H0:4][C;H3]",
    when = function(m) return not m.molecule:has "[$([nX3]-[CX3]=O),$([c][OX2][CX3](=O)[#6])]" end,
    conditions = "base-aq-mild",
    also_attacks = { "ester", "acyl halide", "anhydride", "alkyl halide", "epoxide", "imide", "Fmoc amine" },
    recipe = "LiOH, THF-MeOH-H2O, rt; also: NaOH; TMSOK; LiI, pyridine, reflux",
    yield = { 88, 99 },
    cautions = { "lithium hydroxide" },
    source = "Wuts, Greene's Protective Groups in Organic Synthesis; from memory",
    example { "OC(=O)C1CCN(CC1)C(=O)OC(C)(C)C", from = { "COC(=O)C1CCN(CC1)C(=O)OC(C)(C)C" } },
    refuse { "CC1(C(=O)O)CCCCC1" }, -- too hindered for mild base
    refuse { "CNC(=O)O" }, -- carbamic acid
}

interconversion "ethyl-ester-removal" {
    about = "Ethyl ester deprotection; Boc, tert-butyl ester, benzyl ether, amide survive",
    rxno = "RXNO:0000436",
    target = "[#6;!$([CX4;H0;R]([#6])([#6])[#6]):1][C;X3:2](=[O;X1:3])[O;X2;H1:4]",
    from = "[#6:1][C;X3:2](=[O;X1:3])[O;X2;H0:4][C;H2][C;H3]",
    when = function(m) return not m.molecule:has "[$([nX3]-[CX3]=O),$([c][OX2][CX3](=O)[#6])]" end,
    conditions = "base-aq-mild",
    also_attacks = { "ester", "acyl halide", "anhydride", "alkyl halide", "epoxide", "imide", "Fmoc amine" },
    recipe = "NaOH or LiOH, EtOH-H2O, rt to 50 °C",
    yield = { 88, 99 },
    cautions = { "sodium hydroxide", "lithium hydroxide" },
    source = "Wuts, Greene's Protective Groups in Organic Synthesis; from memory",
    example { "OC(=O)c1cnn(C)c1C(F)(F)F", from = { "CCOC(=O)c1cnn(C)c1C(F)(F)F" } },
    refuse { "CC1(C(=O)O)CCCCC1" }, -- too hindered for mild base
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
    target = "[c;r5,r6;!$(c1ccc1):1][O;X2;H1:2]",
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

-- A hydroxyl group is guarded for the sake of something else in the molecule: without that the detour is pointless.
local OTHERS = "[$([#7,#16,Cl,Br,I]),$([#6]=[#6]),$([#6]#[#6]),$([CX3]=O),$([OX2;!$([OH][CX4])])]"
local function guards_something(m)
    return m.molecule:has(OTHERS) or m.molecule:count "[OX2H]" > 1
end

-- Alloc is chosen where another group has to stay that acid or hydrogen would take off.
local function beside_others(m)
    return m.molecule:has "[$(OC([CH3])([CH3])[CH3]),$([CH2]([OX2])c1ccccc1),$([NX3]C(=O)O)]"
end

disconnection "fmoc-protection" {
    about = "Fmoc protection; survives acid (TFA); removed by secondary amines",
    rxno = "RXNO:0000160",
    target = "[N;X3;+0;!$(N(C=O)[C,S]=[O,S,N]);!$(N[#7,#8,#16]):1]-!@[C;X3:2](=[O;X1:3])[O;X2:4][C;X4;H2:5][C;X4;H1;$(C1c2ccccc2-c2ccccc12):6]",
    cut = { 2, 1 },
    acceptor = { 2, "alkoxycarbonyl" },
    donor = { 1, "amine" },
    conditions = "acylation",
    recipe = "FmocCl or FmocOSu, NaHCO3 or Na2CO3, H2O-dioxane, 0 °C",
    yield = { 85, 97 },
    cautions = { "9-fluorenylmethyl chloroformate" },
    source = "Wuts, Greene's Protective Groups in Organic Synthesis; from memory",
    example { "O=C(O)[C@H](CC(C)C)NC(=O)OCC1c2ccccc2-c2ccccc12",
        from = { "CC(C)C[C@H](N)C(=O)O", "O=C(Cl)OCC1c2ccccc2-c2ccccc12" } },
    example { "C[C@H](NC(=O)OCC1c2ccccc2-c2ccccc12)C(=O)O",
        from = { "C[C@H](N)C(=O)O", "O=C(Cl)OCC1c2ccccc2-c2ccccc12" } },
    refuse { "CNC(=O)OCc1ccccc1" }, -- benzyl carbamate
}

interconversion "fmoc-removal" {
    about = "Fmoc removal (amino group deprotection); Boc, tert-butyl ester, allyl ester, benzyl ether survive",
    rxno = "RXNO:0000320",
    target = "[N;X3;H1,H2;+0;$(N-[CX4]-[CX3]=O);!$(N[C,S]=[O,S,N]);!$(N[#7,#8,#16]);!$(N(c)c):1]",
    from = "[N;X3:1][C;X3](=[O;X1])[O;X2][C;X4;H2]C1c2ccccc2-c2ccccc21",
    conditions = "amine-rt",
    also_attacks = { "alkyl halide", "epoxide" },
    recipe = "piperidine (20 %), DMF, rt; also: Et2NH, MeCN; DBU",
    yield = { 85, 98 },
    cautions = { "piperidine", "N,N-dimethylformamide" },
    source = "Wuts, Greene's Protective Groups in Organic Synthesis; from memory",
    example { "CC(C)(C)OC(=O)C[C@H](N)C(=O)OCC=C",
        from = { "CC(C)(C)OC(=O)C[C@H](NC(=O)OCC1c2ccccc2-c2ccccc12)C(=O)OCC=C" } },
    example { "N[C@@H](Cc1ccccc1)C(=O)NCC(=O)OC",
        from = { "COC(=O)CNC(=O)[C@H](Cc1ccccc1)NC(=O)OCC1c2ccccc2-c2ccccc12" } },
    refuse { "CC(=O)N" }, -- amide nitrogen
}

disconnection "alloc-protection" {
    about = "Allyloxycarbonyl (Alloc) protection of an amine; survives TFA and mild base; removed by Pd(0)",
    rxno = "RXNO:0000321",
    target = "[N;X3;+0;!$(N(C=O)[C,S]=[O,S,N]);!$(N[#7,#8,#16]):1]-!@[C;X3:2](=[O;X1:3])[O;X2:4][C;X4;H2:5][C;X3;H1:6]=[C;X3;H2:7]",
    cut = { 2, 1 },
    acceptor = { 2, "alkoxycarbonyl" },
    donor = { 1, "amine" },
    conditions = "acylation",
    recipe = "AllocCl, pyridine or Na2CO3, THF, 0 °C",
    yield = { 88, 98 },
    cautions = { "allyl chloroformate", "pyridine" },
    source = "Wuts, Greene's Protective Groups in Organic Synthesis; from memory",
    example { "C=CCOC(=O)NC1CCN(CC1)C(=O)OC(C)(C)C", from = { "NC1CCN(CC1)C(=O)OC(C)(C)C", "C=CCOC(=O)Cl" } },
    example { "C=CCOC(=O)N1CCNCC1", from = { "C1CNCCN1", "C=CCOC(=O)Cl" } },
    refuse { "C=CCNC(=O)OC" }, -- allyl on nitrogen, not a carbamate oxygen
}

interconversion "alloc-removal" {
    about = "Palladium-catalysed removal of an Alloc group (amino group deprotection); Boc, Fmoc, tert-butyl ester, benzyl ether survive",
    rxno = "RXNO:0000320",
    target = "[N;X3;H1,H2;!$(N[C,S]=[O,S,N]);!$(N[#7,#8,#16]);!$(N[C;X3]=[C;X3]);!$(N(c)c):1]",
    from = "[N;X3:1][C;X3](=[O;X1])[O;X2][C;X4;H2][C;X3;H1]=[C;X3;H2]",
    when = beside_others,
    conditions = "pd0-allyl",
    also_attacks = { "aryl halide" },
    recipe = "Pd(PPh3)4 (cat), PhSiH3 or Bu3SnH or morpholine, CH2Cl2, rt",
    yield = { 85, 97 },
    cautions = { "triphenylphosphine", "tributyltin hydride" },
    source = "Wuts, Greene's Protective Groups in Organic Synthesis; from memory",
    example { "CC(C)(C)OC(=O)[C@@H](N)CCC(=O)OC", from = { "CC(C)(C)OC(=O)[C@@H](NC(=O)OCC=C)CCC(=O)OC" } },
    example { "NC1CCN(CC1)C(=O)OC(C)(C)C", from = { "C=CCOC(=O)NC1CCN(CC1)C(=O)OC(C)(C)C" } },
    refuse { "CC(=O)N" }, -- amide nitrogen
}

disconnection "pmb-ether-protection" {
    about = "4-Methoxybenzyl (PMB) ether protection of a hydroxyl group; survives base, hydride, fluoride; removed by DDQ or acid",
    rxno = "RXNO:0000323",
    target = "[C;X4;!$(C([#8])[#7,#8,#16]):1][O;X2:2]-!@[C;X4;H2:3][c:4]1[c;H1:5][c;H1:6][c:7]([O;X2:8][C;H3:9])[c;H1:10][c;H1:11]1",
    cut = { 3, 2 },
    acceptor = { 3, "alkyl" },
    donor = { 2, "alcohol" },
    conditions = "alkylation",
    also_attacks = { "free alcohol", "ester" },
    recipe = "NaH, PMBCl, DMF, 0 °C to rt; also: trichloroacetimidate, acid (cat)",
    yield = { 80, 95 },
    cautions = { "sodium hydride", "N,N-dimethylformamide" },
    source = "Wuts, Greene's Protective Groups in Organic Synthesis; from memory",
    example { "COc1ccc(COCCC#C)cc1", from = { "OCCC#C", "COc1ccc(CCl)cc1" } },
    example { "COc1ccc(COCCCCO)cc1", from = { "OCCCCO", "COc1ccc(CCl)cc1" } },
    refuse { "C(OCCC#C)c1ccccc1" }, -- plain benzyl ether
}

interconversion "pmb-ether-removal" {
    about = "Oxidative removal of a PMB ether (hydroxy group deprotection); benzyl ether, silyl ether, acetal, ester, alkene survive",
    rxno = "RXNO:0000430",
    target = "[C;X4;H1,H2;!$(C([#8])[#7,#8,#16]):1][O;X2;H1:2]",
    from = "[C;X4:1][O;X2;H0:2][C;X4;H2]c1ccc(O[C;H3])cc1",
    when = guards_something,
    conditions = "ddq",
    also_attacks = { "indole", "pyrrole", "primary amine", "secondary amine", "aniline", "phenol", "enol ether", "electron-rich arene" },
    recipe = "DDQ, CH2Cl2-H2O (18:1), 0 °C; also: CAN, MeCN-H2O; CF3CO2H",
    yield = { 80, 96 },
    cautions = { "DDQ" },
    source = "Wuts, Greene's Protective Groups in Organic Synthesis; from memory",
    example { "OCC(C)COCc1ccccc1", from = { "COc1ccc(COCC(C)COCc2ccccc2)cc1" } },
    example { "OCCCC=C", from = { "COc1ccc(COCCCC=C)cc1" } },
    refuse { "Oc1ccccc1" }, -- phenol
}

disconnection "tms-protection" {
    about = "TMS ether (silyl protection); short-lived: lost in mild acid, base, silica",
    rxno = "RXNO:0000328",
    target = "[C;X4;!$(C([#8])[#7,#8,#16]):1][O;X2:2][Si;X4:3]([C;H3:4])([C;H3:5])[C;H3:6]",
    from = "[C;X4:1][O;X2;H1:2].[Cl;X1][Si;X4:3]([C;H3:4])([C;H3:5])[C;H3:6]",
    conditions = "silylation",
    also_attacks = { "free acid", "thiol", "primary amine", "secondary amine" },
    recipe = "TMSCl, Et3N or imidazole, CH2Cl2, 0 °C; also: (Me3Si)2NH",
    yield = { 88, 99 },
    cautions = { "chlorotrimethylsilane" },
    source = "Wuts, Greene's Protective Groups in Organic Synthesis; from memory",
    example { "C[Si](C)(C)OC(C)(C)C#C", from = { "CC(C)(O)C#C", "C[Si](C)(C)Cl" } },
    example { "C[Si](C)(C)OC1CCCCC1", from = { "OC1CCCCC1", "C[Si](C)(C)Cl" } },
    refuse { "C=CO[Si](C)(C)C" }, -- silyl enol ether, not an alcohol
}

interconversion "tms-removal" {
    about = "TMS ether removal (silyl deprotection); TBS, TBDPS, benzyl, ester survive",
    rxno = "RXNO:0000692",
    target = "[C;X4;$(C-C#[C,N]):1][O;X2;H1:2]",
    from = "[C;X4:1][O;X2;H0:2][Si;X4]([C;H3])([C;H3])[C;H3]",
    conditions = "acid-aq-mild",
    also_attacks = { "silyl ether" },
    recipe = "HCl (1 M), THF, 0 °C; also: K2CO3, MeOH; citric acid, MeOH; Bu4NF",
    yield = { 90, 99 },
    cautions = { "hydrochloric acid" },
    source = "Wuts, Greene's Protective Groups in Organic Synthesis; from memory",
    example { "N#CC(O)c1ccc(Br)cc1", from = { "N#CC(O[Si](C)(C)C)c1ccc(Br)cc1" } },
    example { "C#CC(C)(C)O", from = { "C#CC(C)(C)O[Si](C)(C)C" } },
    refuse { "Oc1ccccc1" }, -- phenol
}

interconversion "tms-alkyne-removal" {
    about = "Removal of trimethylsilyl from an alkyne; TIPS alkyne, TBS ether, ester (short times) survive",
    target = "[#6:1][C;X2:2]#[C;X2;H1:3]",
    from = "[#6:1][C;X2:2]#[C;X2;H0:3][Si;X4]([C;H3])([C;H3])[C;H3]",
    conditions = "base-aq-mild",
    also_attacks = { "silyl ether", "Fmoc amine" },
    recipe = "K2CO3, MeOH, rt; also: Bu4NF, THF; AgNO3",
    yield = { 90, 99 },
    source = "Wuts, Greene's Protective Groups in Organic Synthesis; from memory",
    example { "C#Cc1ccc(N)cc1F", from = { "Nc1ccc(C#C[Si](C)(C)C)c(F)c1" } },
    example { "C#Cc1ccccc1", from = { "C[Si](C)(C)C#Cc1ccccc1" } },
    refuse { "CC#CC" }, -- internal alkyne without silicon
}

disconnection "tbdps-protection" {
    about = "TBDPS ether (silyl protection); as TBS, but survives stronger acid (removes TBS, THP, trityl first); primary before secondary",
    rxno = "RXNO:0000328",
    target = "[C;X4;!$(C([#8])[#7,#8,#16]):1][O;X2:2][Si;X4:3]([c:4])([c:5])[C;X4;H0:6]([C;H3:7])([C;H3:8])[C;H3:9]",
    from = "[C;X4:1][O;X2;H1:2].[Cl;X1][Si;X4:3]([c:4])([c:5])[C;X4;H0:6]([C;H3:7])([C;H3:8])[C;H3:9]",
    conditions = "silylation",
    also_attacks = { "free acid", "thiol", "primary amine", "secondary amine" },
    recipe = "TBDPSCl, imidazole, DMF or CH2Cl2, 0 °C to rt",
    yield = { 85, 98 },
    cautions = { "N,N-dimethylformamide" },
    source = "Wuts, Greene's Protective Groups in Organic Synthesis; from memory",
    example { "OC(C)CCO[Si](c1ccccc1)(c1ccccc1)C(C)(C)C",
        from = { "OC(C)CCO", "CC(C)(C)[Si](Cl)(c1ccccc1)c1ccccc1" } },
    example { "CC(C)(C)[Si](OCCCO)(c1ccccc1)c1ccccc1", from = { "OCCCO", "CC(C)(C)[Si](Cl)(c1ccccc1)c1ccccc1" } },
    refuse { "CC(C)(C)[Si](C)(C)OC" }, -- tert-butyldimethylsilyl ether
}

interconversion "tbdps-removal" {
    about = "TBDPS ether removal (silyl deprotection); benzyl, PMB, acetal, Boc survive fluoride",
    rxno = "RXNO:0000692",
    target = "[C;X4;H2;!$(C[#7,#8,#16]~[#8]):1][O;X2;H1:2]",
    from = "[C;X4:1][O;X2;H0:2][Si;X4](c1ccccc1)(c1ccccc1)[C;X4]([C;H3])([C;H3])[C;H3]",
    when = guards_something,
    conditions = "fluoride",
    also_attacks = { "alkyl halide", "epoxide" },
    recipe = "Bu4NF, AcOH (buffer for base-sensitive compounds), THF, rt; also: HF·pyridine",
    yield = { 85, 98 },
    cautions = { "tetrabutylammonium fluoride" },
    source = "Wuts, Greene's Protective Groups in Organic Synthesis; from memory",
    example { "OC[C@@H]1CCC(=O)O1", from = { "CC(C)(C)[Si](OC[C@@H]1CCC(=O)O1)(c1ccccc1)c1ccccc1" } },
    example { "OCCC#C", from = { "C#CCCO[Si](c1ccccc1)(c1ccccc1)C(C)(C)C" } },
    refuse { "Oc1ccccc1" }, -- phenol
}

disconnection "thp-protection" {
    about = "Tetrahydropyranyl (THP) ether protection of a hydroxyl group; survives base, hydride, organometallics; new stereocentre (mixture); removed by acid",
    rxno = "RXNO:0000323",
    target = "[C;X4;!$(C([#8])[#7,#8,#16]):1][O;X2:2]-!@[C;X4;H1;r6:3]1[O;X2;r6:4][C;H2:5][C;H2:6][C;H2:7][C;H2:8]1",
    from = "[C;X4:1][O;X2;H1:2].[C;X3;H1:3]1[O;X2:4][C;H2:5][C;H2:6][C;H2:7][C;X3;H1:8]=1",
    conditions = "acid-hot-dry",
    also_attacks = { "free alcohol", "phenol", "thiol" },
    recipe = "dihydropyran, PPTS or TsOH (cat), CH2Cl2, rt",
    yield = { 88, 99 },
    source = "Wuts, Greene's Protective Groups in Organic Synthesis; from memory",
    example { "BrCCCCOC1CCCCO1", from = { "OCCCCBr", "C1CCC=CO1" } },
    example { "C#CCOC1CCCCO1", from = { "C#CCO", "C1CCC=CO1" } },
    refuse { "COCC1CCCCO1" }, -- tetrahydropyran-2-ylmethyl ether is not an acetal
}

interconversion "thp-removal" {
    about = "Removal of a THP ether (hydroxy group deprotection); benzyl, TBDPS, ester, Cbz survive",
    rxno = "RXNO:0000430",
    target = "[C;X4;H1,H2;!$(C([#8])[#7,#8,#16]):1][O;X2;H1:2]",
    from = "[C;X4:1][O;X2;H0:2]C1CCCCO1",
    when = guards_something,
    conditions = "acid-aq-mild",
    also_attacks = { "silyl ether", "epoxide" },
    recipe = "PPTS, EtOH, 55 °C; also: TsOH, MeOH, rt; AcOH-H2O-THF",
    yield = { 88, 98 },
    source = "Wuts, Greene's Protective Groups in Organic Synthesis; from memory",
    example { "OCC/C=C\\CCCC(=O)OC", from = { "COC(=O)CCC/C=C\\CCOC1CCCCO1" } },
    example { "CCCC#CCO", from = { "CCCC#CCOC1CCCCO1" } },
    refuse { "Oc1ccccc1" }, -- phenol
}

disconnection "mom-protection" {
    about = "Methoxymethyl (MOM) ether protection of a hydroxyl group; survives base, organolithiums (directs ortho-lithiation), hydride; removed by acid",
    rxno = "RXNO:0000323",
    target = "[#6;!$([C;X4]([#8])[#8]);!$(C=O):1][O;X2:2][C;X4;H2:3][O;X2:4][C;H3:5]",
    from = "[#6:1][OH:2].Cl[C:3][O:4][C:5]",
    conditions = "alkylation",
    also_attacks = { "free alcohol" },
    recipe = "MOMCl, iPr2NEt, CH2Cl2, 0 °C; also: CH2(OMe)2, P2O5 or acid",
    yield = { 85, 97 },
    cautions = { "chloromethyl methyl ether" },
    source = "Wuts, Greene's Protective Groups in Organic Synthesis; from memory",
    example { "COCOc1ccc(C=O)cc1Br", from = { "Oc1ccc(C=O)cc1Br", "COCCl" } },
    example { "COCOc1ccccc1", from = { "Oc1ccccc1", "COCCl" } },
    refuse { "COCCOc1ccccc1" }, -- 2-methoxyethyl ether is not an acetal
}

interconversion "mom-removal" {
    about = "Removal of a MOM ether (hydroxy group deprotection); methyl ester, benzyl ether, methyl aryl ether survive",
    rxno = "RXNO:0000430",
    target = "[#6;$(c),$([CX4;H0,H1]);!$([C;X4]([#8])[#8]):1][O;X2;H1:2]",
    from = "[#6:1][O;X2;H0:2][C;X4;H2][O;X2][C;H3]",
    when = guards_something,
    conditions = "acid-aq-strong",
    recipe = "HCl (conc, cat), MeOH, 50 °C; also: TFA, CH2Cl2; TMSBr, -30 °C",
    yield = { 85, 97 },
    cautions = { "hydrochloric acid" },
    source = "Wuts, Greene's Protective Groups in Organic Synthesis; from memory",
    example { "COC(=O)c1ccc(O)c(I)c1", from = { "COCOc1ccc(cc1I)C(=O)OC" } },
    example { "Oc1ccccc1C=O", from = { "COCOc1ccccc1C=O" } },
    refuse { "OC(=O)C" }, -- carboxylic acid OH
}

disconnection "pivalate-protection" {
    about = "Pivaloyl protection; primary before secondary; survives acid, mild base; removed by hydride or strong base",
    rxno = "RXNO:0000428",
    target = "[C;X4;!$(C([#8])[#7,#8,#16]):1][O;X2:2][C;X3:3](=[O;X1:4])[C;X4;H0:5]([C;H3:6])([C;H3:7])[C;H3:8]",
    cut = { 3, 2 },
    acceptor = { 3, "acyl" },
    donor = { 2, "alcohol" },
    conditions = "acylation",
    recipe = "PivCl, pyridine, CH2Cl2, 0 °C",
    yield = { 85, 97 },
    cautions = { "pyridine" },
    source = "Wuts, Greene's Protective Groups in Organic Synthesis; from memory",
    example { "OC(CCOC(=O)C(C)(C)C)c1ccccc1", from = { "OC(CCO)c1ccccc1", "CC(C)(C)C(=O)Cl" } },
    example { "CC(C)(C)C(=O)OCCCO", from = { "OCCCO", "CC(C)(C)C(=O)Cl" } },
    refuse { "CC(=O)OC(C)(C)C" }, -- tert-butyl acetate, the reversed ester
}

interconversion "pivalate-removal" {
    about = "Pivaloyl deprotection; acetal, benzyl ether, TBS ether survive hydride",
    rxno = "RXNO:0000429",
    target = "[C;X4;H2:1][O;X2;H1:2]",
    from = "[C;X4:1][O;X2;H0:2][C;X3](=[O;X1])[C;X4]([C;H3])([C;H3])[C;H3]",
    when = guards_something,
    conditions = "dibal",
    also_attacks = { "free acid", "amide", "epoxide", "alkyl halide", "nitro", "azide" },
    recipe = "DIBAL-H, CH2Cl2, -78 °C; also: NaOMe, MeOH, reflux; LiAlH4",
    yield = { 85, 97 },
    cautions = { "diisobutylaluminium hydride" },
    source = "Wuts, Greene's Protective Groups in Organic Synthesis; from memory",
    example { "OCCC1COC(C)(C)O1", from = { "CC(C)(C)C(=O)OCCC1COC(C)(C)O1" } },
    example { "OCCCCOCc1ccccc1", from = { "CC(C)(C)C(=O)OCCCCOCc1ccccc1" } },
    refuse { "Oc1ccccc1" }, -- phenol
}

disconnection "benzoate-protection" {
    about = "Benzoate protection of a hydroxyl group; survives acid, oxidation; does not migrate as easily as acetate; removed by base",
    rxno = "RXNO:0000323",
    target = "[C;X4;!$(C([#8])[#7,#8,#16]):1][O;X2:2][C;X3:3](=[O;X1:4])[c:5]1[c;H1:6][c;H1:7][c;H1:8][c;H1:9][c;H1:10]1",
    cut = { 3, 2 },
    acceptor = { 3, "acyl" },
    donor = { 2, "alcohol" },
    conditions = "acylation",
    recipe = "BzCl, pyridine, CH2Cl2, 0 °C to rt",
    yield = { 88, 98 },
    cautions = { "benzoyl chloride", "pyridine" },
    source = "Wuts, Greene's Protective Groups in Organic Synthesis; from memory",
    example { "O=C(OC1CCC2(CC1)OCCO2)c1ccccc1", from = { "OC1CCC2(CC1)OCCO2", "O=C(Cl)c1ccccc1" } },
    example { "O=C(OC1CCCCC1)c1ccccc1", from = { "OC1CCCCC1", "O=C(Cl)c1ccccc1" } },
    refuse { "COc1ccccc1" }, -- ether, no acyl group
}

interconversion "benzoate-removal" {
    about = "Removal of a benzoate (hydroxy group deprotection); silyl ether, acetal, Boc, benzyl ether survive",
    rxno = "RXNO:0000430",
    target = "[C;X4;H1,H2;!$(C([#8])[#7,#8,#16]);!$([CX4]-[CX4;!H0]-[CX3;!$(C-[O,N])]=[OX1]);!$([CX4]-[CX4]-[NX3;H1,H2;+0;!$(N-[C,S]=[O,S,N]);!$(N-c)]):1][O;X2;H1:2]",
    from = "[C;X4:1][O;X2;H0:2][C;X3](=[O;X1])c1ccccc1",
    when = guards_something,
    conditions = "alkoxide",
    also_attacks = { "epoxide" },
    recipe = "NaOMe, MeOH, rt; also: K2CO3, MeOH; LiOH, THF-H2O",
    yield = { 88, 98 },
    cautions = { "sodium methoxide" },
    source = "Wuts, Greene's Protective Groups in Organic Synthesis; from memory",
    example { "OCC1CCCN1C(=O)OC(C)(C)C", from = { "O=C(OCC1CCCN1C(=O)OC(C)(C)C)c1ccccc1" } },
    example { "OC1CC=CC1", from = { "O=C(OC1CC=CC1)c1ccccc1" } },
    refuse { "CC(=O)CCO" }, -- the acyloxy group beta to a ketone is lost
    refuse { "NCCO" }, -- the acyl group would have gone to the nitrogen
    refuse { "Oc1ccccc1" }, -- phenol
}

disconnection "methyl-ester-protection" {
    about = "Methyl ester (carboxylic acid protection); survives acid, oxidation, hydrogenation; removed by base",
    rxno = "RXNO:0000325",
    target = "[#6:1][C;X3:2](=[O;X1:3])-!@[O;X2:4][C;H3:5]",
    cut = { 2, 4 },
    acceptor = { 2, "acyl-acid" },
    donor = { 4, "alcohol" },
    conditions = "acid-hot-dry",
    recipe = "SOCl2 or H2SO4 (cat), MeOH, reflux; also: TMSCHN2; MeI, K2CO3",
    yield = { 88, 98 },
    cautions = { "thionyl chloride", "sulfuric acid" },
    source = "Wuts, Greene's Protective Groups in Organic Synthesis; from memory",
    example { "COC(=O)c1ccc(O)cc1Cl", from = { "OC(=O)c1ccc(O)cc1Cl", "CO" } },
    example { "COC(=O)c1ccccc1", from = { "OC(=O)c1ccccc1", "CO" } },
    refuse { "CNC(=O)OC" }, -- carbamate
}

disconnection "tert-butyl-ester-protection" {
    about = "tert-Butyl protection of an acid; survives base, nucleophiles, hydrogenation; removed by acid",
    rxno = "RXNO:0000432",
    target = "[#6:1][C;X3:2](=[O;X1:3])-!@[O;X2:4][C;X4;H0:5]([C;H3:6])([C;H3:7])[C;H3:8]",
    cut = { 2, 4 },
    acceptor = { 2, "acyl-acid" },
    donor = { 4, "alcohol" },
    conditions = "acylation",
    recipe = "Boc2O, DMAP, tBuOH; also: DCC, DMAP, tBuOH; isobutene, H2SO4; tert-butyl trichloroacetimidate",
    yield = { 75, 95 },
    cautions = { "di-tert-butyl dicarbonate", "4-dimethylaminopyridine" },
    source = "Wuts, Greene's Protective Groups in Organic Synthesis; from memory",
    example { "O=C(OC(C)(C)C)c1ccc(Br)nc1", from = { "O=C(O)c1ccc(Br)nc1", "CC(C)(C)O" } },
    example { "CC(C)(C)OC(=O)c1ccccc1", from = { "OC(=O)c1ccccc1", "CC(C)(C)O" } },
    refuse { "CNC(=O)OC(C)(C)C" }, -- Boc carbamate
}

disconnection "benzyl-ester-protection" {
    about = "Benzyl ester (carboxylic acid protection); survives TFA, mild base; removed by hydrogenolysis",
    rxno = "RXNO:0000325",
    target = "[#6:1][C;X3:2](=[O;X1:3])[O;X2:4]-!@[C;X4;H2:5][c:6]1[c;H1:7][c;H1:8][c;H1:9][c;H1:10][c;H1:11]1",
    cut = { 5, 4 },
    acceptor = { 5, "alkyl" },
    donor = { 4, "carboxylate" },
    conditions = "alkylation",
    also_attacks = { "tertiary amine" },
    recipe = "BnBr, K2CO3 or Cs2CO3, DMF, rt; also: BnOH, DCC, DMAP",
    yield = { 85, 97 },
    cautions = { "benzyl bromide", "N,N-dimethylformamide" },
    source = "Wuts, Greene's Protective Groups in Organic Synthesis; from memory",
    example { "O=C(OCc1ccccc1)[C@H](Cc1ccccc1)NC(=O)OC(C)(C)C",
        from = { "OC(=O)[C@H](Cc1ccccc1)NC(=O)OC(C)(C)C", "BrCc1ccccc1" } },
    example { "O=C(OCc1ccccc1)c1ccccc1O", from = { "OC(=O)c1ccccc1O", "BrCc1ccccc1" } },
    refuse { "CNC(=O)OCc1ccccc1" }, -- Cbz carbamate
}

interconversion "benzyl-ester-removal" {
    about = "Hydrogenolysis of a benzyl ester (carboxy group deprotection); Boc, tert-butyl and methyl ester, silyl ether survive",
    rxno = "RXNO:0000433",
    target = "[#6:1][C;X3:2](=[O;X1:3])[O;X2;H1:4]",
    from = "[#6:1][C;X3:2](=[O;X1:3])[O;X2;H0:4][C;X4;H2]c1ccccc1",
    conditions = "h2-pd",
    also_attacks = { "aryl halide", "thiol", "thioether" },
    recipe = "H2, Pd/C, EtOAc or MeOH, rt; also: LiOH; BCl3",
    yield = { 90, 99 },
    cautions = { "hydrogen" },
    source = "Wuts, Greene's Protective Groups in Organic Synthesis; from memory",
    example { "OC(=O)CCC(=O)OC(C)(C)C", from = { "CC(C)(C)OC(=O)CCC(=O)OCc1ccccc1" } },
    example { "OC(=O)[C@H](C)NC(=O)OC(C)(C)C", from = { "C[C@H](NC(=O)OC(C)(C)C)C(=O)OCc1ccccc1" } },
    refuse { "CNC(=O)O" }, -- carbamic acid
}

disconnection "acetonide-protection" {
    about = "Acetonide of a 1,2-diol (protection); 1,2-diol before 1,3-diol with acetone; cis in rings; survives base, hydride, oxidation, hydrogenation; removed by acid",
    rxno = "RXNO:0000078",
    target = "[C;X4:1]1[O;X2;r5:2][C;X4;r5:3]([C;H3:4])([C;H3:5])[O;X2;r5:6][C;X4:7]1",
    from = "[C;X4:1]([O;X2;H1:2])[C;X4:7][O;X2;H1:6].[C;X3:3]([C;H3:4])([C;H3:5])=[O;X1]",
    conditions = "acid-hot-dry",
    recipe = "acetone or Me2C(OMe)2, TsOH or CSA (cat), rt; also: CH2=C(OMe)Me",
    yield = { 80, 97 },
    source = "Wuts, Greene's Protective Groups in Organic Synthesis; from memory",
    example { "OC[C@@H]1COC(C)(C)O1", from = { "OC[C@@H](O)CO", "CC(C)=O" } },
    example { "CC1(C)OC[C@@H](O1)C(=O)OC", from = { "COC(=O)[C@H](O)CO", "CC(C)=O" } },
    refuse { "CC1OCCO1" }, -- ethylidene acetal: comes from acetaldehyde
}

interconversion "acetonide-removal" {
    about = "Hydrolysis of an acetonide (hydroxy group deprotection); benzyl ether, ester, Cbz survive; terminal before internal acetonide",
    rxno = "RXNO:0000430",
    target = "[C;X4:1]([O;X2;H1:2])[C;X4:7][O;X2;H1:6]",
    from = "[C;X4:1]1[O;X2;H0:2][C;X4]([C;H3])([C;H3])[O;X2;H0:6][C;X4:7]1",
    conditions = "acid-aq-mild",
    also_attacks = { "tert-butyl ester", "Boc amine", "silyl ether", "MOM ether", "epoxide",
        "tertiary alcohol" },
    recipe = "AcOH-H2O, 40-60 °C; also: HCl, MeOH; TFA-H2O; CuCl2",
    yield = { 85, 98 },
    source = "Wuts, Greene's Protective Groups in Organic Synthesis; from memory",
    example { "OC[C@H](O)COCc1ccccc1", from = { "CC1(C)OC[C@@H](COCc2ccccc2)O1" } },
    example { "OC[C@@H](O)C=C", from = { "C=C[C@H]1COC(C)(C)O1" } },
    refuse { "OCCCO" }, -- 1,3-diol: six-membered acetonide has its own rule
}

disconnection "dithiane-protection" {
    about = "1,3-Dithiane of an aldehyde (carbonyl group protection); survives acid and base; C-H acidic (acyl anion equivalent); removed by Hg(II) or oxidants",
    rxno = "RXNO:0000657",
    target = "[#6:1][C;X4;H1;r6:2]1[S;X2;r6:3][C;H2:4][C;H2:5][C;H2:6][S;X2;r6:7]1",
    from = "[#6:1][C;X3;H1:2]=[O;X1].[S;X2;H1:3][C;H2:4][C;H2:5][C;H2:6][S;X2;H1:7]",
    conditions = "lewis-acid",
    also_attacks = { "aldehyde", "ketone", "enone" },
    recipe = "HS(CH2)3SH, BF3·OEt2 or I2 (cat), CH2Cl2, 0 °C",
    yield = { 85, 98 },
    cautions = { "propanedithiol", "boron trifluoride etherate" },
    source = "Wuts, Greene's Protective Groups in Organic Synthesis; from memory",
    example { "COc1ccc(cc1)C1SCCCS1", from = { "COc1ccc(C=O)cc1", "SCCCS" } },
    example { "C1CSC(SC1)c1ccccc1", from = { "O=Cc1ccccc1", "SCCCS" } },
    refuse { "C1CSCCSC1" }, -- two sulfurs on different carbons
}

interconversion "dithiane-removal" {
    about = "Hydrolysis of a 1,3-dithiane (deprotection); acetal, silyl ether, ester survive",
    rxno = "RXNO:0000203",
    target = "[#6:1]-!@[C;X3;!R:2](-!@[#6;!$([CX4;H3]):3])=[O;X1]",
    from = "[#6:1][C:2]1([#6:3])SCCCS1",
    conditions = "periodate",
    also_attacks = { "alkene", "phenol", "primary amine" },
    recipe = "PhI(OCOCF3)2, MeCN-H2O, 0 °C; also: HgCl2, CaCO3, MeCN-H2O; MeI, CaCO3; NCS, AgNO3",
    yield = { 75, 95 },
    cautions = { "mercury(II) chloride" },
    source = "Wuts, Greene's Protective Groups in Organic Synthesis; from memory",
    example { "CCCCC(=O)c1ccc(OC)cc1", from = { "CCCCC1(SCCCS1)c1ccc(OC)cc1" } },
    example { "CCC(=O)c1ccccc1", from = { "CCC1(SCCCS1)c1ccccc1" } },
    refuse { "CC(=O)OC" }, -- ester carbonyl
}

disconnection "phthalimide-protection" {
    about = "Phthalimide protection; primary amines only; survives acid, oxidation; removed by hydrazine",
    rxno = "RXNO:0000418",
    target = "[O;X1:6]=[C;X3:1]1[c:7][c:8][C;X3:3](=[O;X1:9])[N;X3:2]1[#6:4]",
    from = "[O;X1:6]=[C;X3:1]1[c:7][c:8][C;X3:3](=[O;X1:9])[O;X2]1.[N;X3;H2:2][#6:4]",
    conditions = "acid-hot-dry",
    also_attacks = { "primary amine", "secondary amine", "thiol" },
    recipe = "phthalic anhydride, AcOH, reflux or toluene, Et3N, Dean-Stark; also: N-ethoxycarbonylphthalimide, Na2CO3 (no racemisation)",
    yield = { 80, 95 },
    cautions = { "phthalic anhydride" },
    source = "Wuts, Greene's Protective Groups in Organic Synthesis; from memory",
    example { "O=C1CCC(N2C(=O)c3ccccc3C2=O)C(=O)N1", from = { "O=C1OC(=O)c2ccccc12", "NC1CCC(=O)NC1=O" } },
    example { "O=C1c2ccccc2C(=O)N1Cc1ccccc1", from = { "O=C1OC(=O)c2ccccc12", "NCc1ccccc1" } },
    refuse { "O=C1NC(=O)c2ccccc12" }, -- phthalimide itself: nothing on nitrogen
}

interconversion "phthalimide-removal" {
    about = "Phthalimide deprotection; Boc, Cbz, benzyl ether, silyl ether survive",
    rxno = "RXNO:0000419",
    target = "[C;X4;H1,H2;!$(C([#7])[#7,#8,#16]):1][N;X3;H2:2]",
    from = "[C;X4:1][N;X3;H0:2]1C(=O)c2ccccc2C1=O",
    conditions = "hydrazine",
    recipe = "N2H4·H2O, EtOH, rt to reflux; also: MeNH2; NaBH4, iPrOH then AcOH",
    yield = { 80, 96 },
    cautions = { "hydrazine" },
    source = "Wuts, Greene's Protective Groups in Organic Synthesis; from memory",
    example { "CCOC1CCC(N)CC1", from = { "CCOC1CCC(CC1)N1C(=O)c2ccccc2C1=O" } },
    example { "NC1CCCC1", from = { "O=C1c2ccccc2C(=O)N1C1CCCC1" } },
    refuse { "CNC" }, -- secondary amine is not released
}

disconnection "trityl-ether-protection" {
    about = "Trityl ether protection of a primary hydroxyl group; primary alcohol only; survives base, hydride; removed by mild acid",
    rxno = "RXNO:0000323",
    target = "[C;X4;H2:1][O;X2:2][C;X4;H0:3]([c:4])([c:5])[c:6]",
    from = "[C;X4;H2:1][O;X2;H1:2].[Cl;X1][C;X4;H0:3]([c:4])([c:5])[c:6]",
    conditions = "silylation",
    also_attacks = { "primary amine", "thiol" },
    recipe = "TrCl, pyridine or Et3N, DMAP (cat), CH2Cl2, rt",
    yield = { 80, 95 },
    cautions = { "pyridine", "4-dimethylaminopyridine" },
    source = "Wuts, Greene's Protective Groups in Organic Synthesis; from memory",
    example { "OC(C)COC(c1ccccc1)(c1ccccc1)c1ccccc1", from = { "OC(C)CO", "ClC(c1ccccc1)(c1ccccc1)c1ccccc1" } },
    example { "C(OCc1ccccc1)COC(c1ccccc1)(c1ccccc1)c1ccccc1",
        from = { "OCCOCc1ccccc1", "ClC(c1ccccc1)(c1ccccc1)c1ccccc1" } },
    refuse { "CC(C)OC(c1ccccc1)(c1ccccc1)c1ccccc1" }, -- secondary alcohol: too hindered under these conditions
}

interconversion "trityl-ether-removal" {
    about = "Removal of a trityl ether (hydroxy group deprotection); ester, benzyl ether, TBDPS survive; acyl migration possible",
    rxno = "RXNO:0000430",
    target = "[C;X4;H2:1][O;X2;H1:2]",
    from = "[C;X4;H2:1][O;X2;H0:2][C;X4](c1ccccc1)(c1ccccc1)c1ccccc1",
    when = guards_something,
    conditions = "acid-aq-mild",
    also_attacks = { "silyl ether", "epoxide" },
    recipe = "HCO2H or AcOH-H2O, rt; also: TFA (1 %), Et3SiH; CSA, MeOH",
    yield = { 85, 97 },
    cautions = { "formic acid" },
    source = "Wuts, Greene's Protective Groups in Organic Synthesis; from memory",
    example { "CC(=O)OC(C)CO", from = { "CC(=O)OC(C)COC(c1ccccc1)(c1ccccc1)c1ccccc1" } },
    example { "OCCCC#C", from = { "C#CCCCOC(c1ccccc1)(c1ccccc1)c1ccccc1" } },
    refuse { "CC(C)O" }, -- secondary alcohol (trityl sits on primary alcohols)
}

disconnection "tosyl-amide-protection" {
    about = "Tosyl protection of an amine (amino group protection); survives acid, base, oxidation, organometallics; N-H of primary amines becomes acidic; hard to remove",
    rxno = "RXNO:0000321",
    target = "[N;X3;!$(NC=[O,S,N]):1][S;X4:2](=[O;X1:3])(=[O;X1:4])[c:5]1[c;H1:6][c;H1:7][c:8]([C;H3:9])[c;H1:10][c;H1:11]1",
    cut = { 2, 1 },
    acceptor = { 2, "sulfonyl" },
    donor = { 1, "amine" },
    conditions = "acylation",
    recipe = "TsCl, Et3N or pyridine, CH2Cl2, 0 °C",
    yield = { 85, 98 },
    cautions = { "4-toluenesulfonyl chloride", "pyridine" },
    source = "Wuts, Greene's Protective Groups in Organic Synthesis; from memory",
    example { "Cc1ccc(cc1)S(=O)(=O)N1CC=CC1", from = { "C1C=CCN1", "Cc1ccc(cc1)S(=O)(=O)Cl" } },
    example { "Cc1ccc(cc1)S(=O)(=O)NCc1ccccc1", from = { "NCc1ccccc1", "Cc1ccc(cc1)S(=O)(=O)Cl" } },
    refuse { "CS(=O)(=O)N1CCCC1" }, -- methanesulfonamide
}

interconversion "tosyl-amide-removal" {
    about = "Removal of a tosyl group from an amine (amino group deprotection); alkyl and aryl ethers survive",
    rxno = "RXNO:0000320",
    target = "[N;X3;H1;+0;R;!$(N[C,S]=[O,S,N]);!$(N[#7,#8,#16]);!$(N[C;X3]=[C;X3]):1]",
    from = "[N;X3:1][S;X4](=[O;X1])(=[O;X1])c1ccc([C;H3])cc1",
    conditions = "birch",
    recipe = "Na, naphthalene, DME, -78 °C; also: Mg, MeOH; HBr, AcOH, PhOH; SmI2",
    yield = { 70, 92 },
    cautions = { "sodium naphthalenide" },
    source = "Wuts, Greene's Protective Groups in Organic Synthesis; from memory",
    example { "COc1ccc2NCCCc2c1", from = { "COc1ccc2c(c1)CCCN2S(=O)(=O)c1ccc(C)cc1" } },
    example { "C1CCNC1", from = { "Cc1ccc(cc1)S(=O)(=O)N1CCCC1" } },
    refuse { "CC(=O)N" }, -- amide nitrogen
}
