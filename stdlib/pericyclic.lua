-- Pericyclic reactions.
-- Yields are typical ranges and sources stand from memory unless a source says otherwise.

pack {
    name = "pericyclic",
    version = "0.1.0",
    licence = "CC0-1.0",
    about = "Pericyclic reactions",
    needs = { "synthons", "preferences" },
}

disconnection "diels-alder" {
    about = "Diels-Alder reaction; para/ortho rule; suprafacial: the geometry of the dienophile is kept; endo",
    rxno = "RXNO:0000006",
    target = "[CX4:1]1-[CX3:2]=[CX3:3]-[CX4;!x3:4]-[CX4;$(C-[$([CX3]=O),$(C#N),$([N+](=O)[O-])]):5]-[CX4:6]-1",
    from = "[C:1]=[C:2]-[C:3]=[C:4].[C:5]=[C:6]",
    addition = { "syn", 5, 6 },
    prefer = { "diels-alder", first = 1, near = 2, far = 3, last = 4, active = 5, other = 6 },
    conditions = "heat-200",
    also_attacks = { "other diene", "other activated alkene", "thiol", "primary amine" },
    recipe = "toluene, 80-140 °C; Et2AlCl or AlCl3, CH2Cl2, 0 °C",
    yield = { 65, 95 },
    source = "Clayden, Greeves, Warren, Organic Chemistry; from memory",
    example { "COC(=O)C1CCC(C)=CC1", from = { "C=CC(=C)C", "C=CC(=O)OC" } },
    refuse { "C1CCC=CC1" }, -- no activating group: ethylene does not react at ordinary temperature
}

disconnection "diels-alder-anhydride" {
    about = "Diels-Alder reaction with maleic anhydride or an imide; cis ring fusion, endo",
    rxno = "RXNO:0000006",
    target = "[CX4;!x3:1]1-[CX3:2]=[CX3:3]-[CX4;!x3:4]-[CX4:5]2-[CX3:7](=[OX1:8])-[OX2,NX3:9]-[CX3:10](=[OX1:11])-[CX4:6]-1-2",
    from = "[C:1]=[C:2]-[C:3]=[C:4].[C:5]1-[C:7](=[O:8])-[*:9]-[C:10](=[O:11])-[C:6]=1",
    conditions = "heat-200",
    also_attacks = { "other diene", "primary amine", "thiol", "free alcohol" },
    recipe = "toluene, 25-110 °C",
    yield = { 80, 98 },
    cautions = { "maleic anhydride" },
    source = "Clayden, Greeves, Warren, Organic Chemistry; from memory",
    example { "CC1=CC[C@@H]2C(=O)N(c3ccccc3)C(=O)[C@@H]2C1", from = { "C=CC(=C)C", "O=C1C=CC(=O)N1c1ccccc1" } },
    refuse { "O=C1OC(=O)C2CCCCC12" }, -- no alkene in the new ring
}

disconnection "diels-alder-bridged" {
    about = "Diels-Alder reaction of a cyclic diene; endo",
    rxno = "RXNO:0000006",
    target = "[CX4;x3:1]1-[CX3:2]=[CX3:3]-[CX4;x3:4]-[CX4;$(C-[$([CX3]=O),$(C#N),$([N+](=O)[O-])]):5]-[CX4:6]-1",
    from = "[C:1]=[C:2]-[C:3]=[C:4].[C:5]=[C:6]",
    conditions = "heat-200",
    also_attacks = { "other activated alkene", "thiol", "primary amine" },
    recipe = "neat or CH2Cl2, 0-40 °C (cyclopentadiene freshly cracked); Et2AlCl at -20 °C",
    yield = { 75, 95 },
    cautions = { "cyclopentadiene" },
    source = "Clayden, Greeves, Warren, Organic Chemistry; from memory",
    example { "COC(=O)C1CC2C=CC1C2", from = { "C1=CCC=C1", "C=CC(=O)OC" } },
    example { "N#CC1CC2CC1C=C2", from = { "C1=CCC=C1", "C=CC#N" } },
    example { "O=C1OC(=O)C2C3CC(C=C3)C12", from = { "C1=CCC=C1", "O=C1C=CC(=O)O1" } },
    refuse { "C1CC2C=CC1C2" }, -- no activating group
}

disconnection "diels-alder-alkyne" {
    about = "Diels-Alder reaction with an alkyne; 1,4-cyclohexadiene, oxidised easily to the arene",
    rxno = "RXNO:0000006",
    target = "[CX4:1]1-[CX3:2]=[CX3:3]-[CX4:4]-[CX3;R1;$(C-[$([CX3](=O)[#6,O]),$(C#N)]):5]=[CX3;R1:6]-1",
    from = "[C:1]=[C:2]-[C:3]=[C:4].[C:5]#[C:6]",
    conditions = "heat-200",
    also_attacks = { "other diene", "primary amine", "thiol" },
    recipe = "toluene, 80-120 °C",
    yield = { 70, 95 },
    cautions = { "dimethyl acetylenedicarboxylate (lachrymator)" },
    source = "Clayden, Greeves, Warren, Organic Chemistry; from memory",
    example { "COC(=O)C1=C(C(=O)OC)CC(C)=C(C)C1", from = { "C=C(C)C(C)=C", "COC(=O)C#CC(=O)OC" } },
    example { "COC(=O)C1=C(CC=CC1)C(=O)OC", from = { "C=CC=C", "COC(=O)C#CC(=O)OC" } },
    refuse { "C1=CCC=CC1" }, -- no activating group on the second alkene
}

disconnection "diels-alder-quinone" {
    about = "Diels-Alder reaction with a quinone; cis fusion; the less electron-rich alkene of the quinone reacts",
    rxno = "RXNO:0000006",
    target = "[CX4:1]1-[CX3:2]=[CX3:3]-[CX4:4]-[CX4:5]2-[CX3:7](=[OX1:8])-[#6:9]=,:[#6:10]-[CX3:11](=[OX1:12])-[CX4:6]-1-2",
    from = "[C:1]=[C:2]-[C:3]=[C:4].[C:5]1-[C:7](=[O:8])-[#6:9]=[#6:10]-[C:11](=[O:12])-[C:6]=1",
    conditions = "heat-200",
    also_attacks = { "other diene", "primary amine", "thiol" },
    recipe = "toluene or EtOH, 25-80 °C; ZnCl2 or BF3",
    yield = { 70, 95 },
    cautions = { "benzoquinone" },
    source = "Clayden, Greeves, Warren, Organic Chemistry; from memory",
    example { "COC1=CC(=O)C2CC=C(C)CC2C1=O", from = { "C=CC(=C)C", "COC1=CC(=O)C=CC1=O" } },
    example { "O=C1C=CC(=O)C2CC=CCC12", from = { "C=CC=C", "O=C1C=CC(=O)C=C1" } },
    refuse { "O=C1CCC(=O)C2CC=CCC12" }, -- no enedione: the dienophile is not a quinone
}

disconnection "hetero-diels-alder-oxa" {
    about = "Oxa-Diels-Alder reaction with Danishefsky's diene; formal [4+2]; Felkin with α-chiral aldehydes",
    rxno = "RXNO:0000310",
    target = "[OX2:1]1-[CX4;H1:2]-[CX4;H2:3]-[CX3:4](=[OX1:5])-[CX3;H1:6]=[CX3;H1:7]-1",
    from = "[O:1]=[C:2].CO[C:7]=[C:6]-[C:4](=[C:3])-[O:5][Si](C)(C)C",
    conditions = "lewis-acid",
    also_attacks = { "free alcohol", "primary amine", "other aldehyde" },
    recipe = "ZnCl2, Eu(fod)3, BF3 or Ti(OiPr)4/BINOL, THF or toluene, then TFA",
    yield = { 60, 90 },
    source = "Danishefsky, Kerwin, Kobayashi, J. Am. Chem. Soc. 1982, 104, 358; from memory",
    example { "O=C1C=COC(c2ccc([N+](=O)[O-])cc2)C1",
        from = { "O=Cc1ccc([N+](=O)[O-])cc1", "COC=CC(=C)O[Si](C)(C)C" } },
    example { "O=C1C=COC(C1)c1ccccc1", from = { "O=Cc1ccccc1", "COC=CC(=C)O[Si](C)(C)C" } },
    refuse { "O=C1CCOC(c2ccccc2)C1" }, -- the saturated ring is one step further
}

disconnection "hetero-diels-alder-aza" {
    about = "Aza-Diels-Alder reaction with Danishefsky's diene; formal [4+2]",
    rxno = "RXNO:0000092",
    target = "[NX3:1]1(-[#6;!$([#6]=O):8])-[CX4;H1:2]-[CX4;H2:3]-[CX3:4](=[OX1:5])-[CX3;H1:6]=[CX3;H1:7]-1",
    from = "[N:1](-[#6:8])=[C:2].CO[C:7]=[C:6]-[C:4](=[C:3])-[O:5][Si](C)(C)C",
    conditions = "lewis-acid",
    also_attacks = { "free alcohol", "aldehyde" },
    recipe = "ZnCl2 or Yb(OTf)3, THF or MeCN, rt, then aq. HCl",
    yield = { 60, 85 },
    source = "Kürti, Czakó, Strategic Applications of Named Reactions in Organic Synthesis; from memory",
    example { "O=C1C=CN(Cc2ccccc2)C(c2ccc(F)cc2)C1",
        from = { "Fc1ccc(C=NCc2ccccc2)cc1", "COC=CC(=C)O[Si](C)(C)C" } },
    example { "O=C1C=CN(c2ccccc2)C(C1)c1ccccc1", from = { "C(=Nc1ccccc1)c1ccccc1", "COC=CC(=C)O[Si](C)(C)C" } },
    refuse { "O=C1CCN(Cc2ccccc2)CC1" }, -- a piperidone without the enaminone: Dieckmann
}

disconnection "claisen-aromatic" {
    about = "Aromatic Claisen rearrangement; ortho, with allylic transposition; para when both ortho are blocked",
    rxno = "RXNO:0000208",
    target = "[OX2H1:1]-[c:2]:[c:3]-[CX4;!$(C-[OX2,NX3]):4]-[CX3:5]=[CX3:6]",
    from = "[O:1](-[c:2]:[cH:3])-[C:6]-[C:5]=[C:4]",
    conditions = "heat-200",
    also_attacks = { "acid-labile acetal", "tert-butyl ester" },
    recipe = "180-220 °C, Et2NPh or neat; BCl3 or Et2AlCl at rt",
    yield = { 60, 90 },
    source = "Clayden, Greeves, Warren, Organic Chemistry; from memory",
    example { "C=CCc1cc(C(=O)OC)ccc1O", from = { "C=CCOc1ccc(C(=O)OC)cc1" } },
    example { "C=CCc1ccccc1O", from = { "C=CCOc1ccccc1" } },
    refuse { "C=CCc1ccc(O)cc1" }, -- para to the phenol: needs both ortho positions blocked
}

disconnection "claisen-aliphatic" {
    about = "Claisen rearrangement of an allyl vinyl ether; allylic transposition, chair: E alkene",
    rxno = "RXNO:0000148",
    target = "[OX1:1]=[CX3;H1:2]-[CX4;H1,H2:3]-[CX4;!$(C-[OX2,NX3]):4]-[CX3:5]=[CX3:6]",
    from = "[O:1](-[C:2]=[C:3])-[C:6]-[C:5]=[C:4]",
    conditions = "heat-200",
    also_attacks = { "free acid", "acid-labile acetal" },
    recipe = "toluene or neat, 110-190 °C; vinyl ether from the allylic alcohol, ethyl vinyl ether and Hg(OAc)2",
    yield = { 60, 90 },
    cautions = { "mercury(II) acetate" },
    source = "Clayden, Greeves, Warren, Organic Chemistry; from memory",
    example { "C=CC(C)(C)CC=O", from = { "C=COCC=C(C)C" } },
    example { "C=CCCC=O", from = { "C=CCOC=C" } },
    refuse { "CC(=O)CCC=C" }, -- a ketone: ketones come through the Carroll rearrangement
}

disconnection "johnson-claisen" {
    about = "Johnson-Claisen rearrangement; allylic transposition; E alkene from a secondary alcohol",
    rxno = "RXNO:0000153",
    target = "[CX4;H3:10]-[CX4;H2:9]-[OX2:8]-[CX3:2](=[OX1:1])-[CX4;H2:3]-[CX4;!$(C-[OX2,NX3]):4]-[CX3:5]=[CX3:6]",
    from = "O[C:6]-[C:5]=[C:4].[C:10]-[C:9]-[O:8]-[C:2](-[O:1]CC)(OCC)[C:3]",
    conditions = "heat-200",
    also_attacks = { "free acid", "primary amine", "other free alcohol", "aldehyde" },
    recipe = "MeC(OEt)3, EtCO2H cat., 130-145 °C, ethanol distilled off",
    yield = { 65, 90 },
    source = "Johnson et al., J. Am. Chem. Soc. 1970, 92, 741; from memory",
    example { "C=CC(C)(C)CC(=O)OCC", from = { "CC(C)=CCO", "CCOC(C)(OCC)OCC" } },
    example { "C=CCCC(=O)OCC", from = { "C=CCO", "CCOC(C)(OCC)OCC" } },
    refuse { "CCOC(=O)CCC" }, -- no alkene at the γ,δ position
}

disconnection "ireland-claisen" {
    about = "Ireland-Claisen rearrangement; chair; E enolate (THF) gives anti, Z enolate (HMPA) gives syn",
    rxno = "RXNO:0000149",
    target = "[OX2H1:1]-[CX3:2](=[OX1:3])-[CX4;H0,H1,H2:4]-[CX4;!$(C-[OX2,NX3]):5]-[CX3:6]=[CX3:7]",
    from = "[C:4]-[C:2](=[O:3])-[O:1]-[C:7]-[C:6]=[C:5]",
    conditions = "base-hindered",
    also_attacks = { "primary amine", "secondary amine", "ketone", "alkyl halide", "nitro" },
    recipe = "LDA, THF (HMPA), -78 °C, TMSCl, then rt to 60 °C",
    yield = { 60, 85 },
    cautions = { "butyllithium", "chlorotrimethylsilane" },
    source = "Ireland, Mueller, Willard, J. Am. Chem. Soc. 1976, 98, 2868; from memory",
    example { "C=CC(C)C(C)C(=O)O", from = { "CCC(=O)OCC=CC" } },
    example { "C=CCCC(=O)O", from = { "C=CCOC(C)=O" } },
    refuse { "C=CCCCC(=O)O" }, -- alkene one carbon too far from the acid
}

disconnection "oxy-cope" {
    about = "Anionic oxy-Cope rearrangement; chair; two-carbon chain lengthening or ring expansion by four",
    rxno = "RXNO:0000029",
    target = "[OX1:1]=[CX3;$(C([#6])[#6]):2]-[CX4;H1,H2;!$(C-[OX2,NX3]):3]-[CX4;!$(C-[OX2,NX3]):4]-[CX4:5]-[CX3:6]=[CX3;!$(C-[CX3]=O):7]",
    from = "[O:1]-[C:2](-[C:3]=[C:4])-[C:7]-[C:6]=[C:5]",
    conditions = "base-hindered",
    also_attacks = { "ester", "alkyl halide" },
    recipe = "KH, 18-crown-6, THF, 0 °C to reflux; KHMDS",
    yield = { 60, 90 },
    cautions = { "potassium hydride" },
    source = "Evans, Golob, J. Am. Chem. Soc. 1975, 97, 4765; from memory",
    example { "CC(=O)CCCC=C", from = { "C=CCC(C)(O)C=C" } },
    example { "O=C1CCCC=CCCCC1", from = { "OC1(C=C)CCCCC1C=C" } },
    refuse { "CC(=O)CCCCC=C" }, -- one carbon too many between the ends
}

disconnection "cope" {
    about = "Cope rearrangement; toward the conjugated alkene, chair",
    rxno = "RXNO:0000028",
    target = "[CX3;$(C(-[$(C#N),$([CX3]=O)])-[$(C#N),$([CX3]=O)]):1]=[CX3:2]-[CX4:3]-!@[CX4:4]-[CX3:5]=[CX3:6]",
    from = "[C:3]=[C:2]-[C:1]-[C:6]-[C:5]=[C:4]",
    conditions = "heat-200",
    also_attacks = { "other diene", "thiol" },
    recipe = "toluene or neat, 110-200 °C",
    yield = { 65, 90 },
    source = "Clayden, Greeves, Warren, Organic Chemistry; from memory",
    example { "C=CCCC(C)=C(C#N)C(=O)OCC", from = { "C=CCC(C#N)(C(=O)OCC)C(C)=C" } },
    example { "C=CCCC=C(C#N)C(=O)OCC", from = { "C=CCC(C=C)(C#N)C(=O)OCC" } },
    refuse { "C=CCCC=C" }, -- degenerate: nothing drives it
}

disconnection "azide-alkyne-copper" {
    about = "Copper-catalysed azide-alkyne cycloaddition; 1,4-disubstituted only",
    rxno = "RXNO:0000270",
    target = "[nX3;+0:1]1(-[#6:6]):[nX2;+0:2]:[nX2;+0:3]:[c;H0:4](-[#6:7]):[cH1:5]:1",
    from = "[N+0:1](-[#6:6])=[N+:2]=[N-:3].[C:5]#[C:4]-[#6:7]",
    conditions = "cu",
    recipe = "CuSO4, sodium ascorbate, tBuOH/H2O, rt; CuI, DIPEA",
    yield = { 80, 98 },
    cautions = { "organic azide (small ones explosive)" },
    source = "Rostovtsev, Green, Fokin, Sharpless, Angew. Chem. Int. Ed. 2002, 41, 2596; from memory",
    example { "OCc1cn(Cc2ccccc2)nn1", from = { "[N-]=[N+]=NCc1ccccc1", "C#CCO" } },
    example { "c1ccc(Cn2cc(nn2)-c2ccccc2)cc1", from = { "[N-]=[N+]=NCc1ccccc1", "C#Cc1ccccc1" } },
    refuse { "OCc1cnnn1Cc1ccccc1" }, -- the 1,5-isomer: ruthenium
}

disconnection "azide-alkyne-ruthenium" {
    about = "Ruthenium-catalysed azide-alkyne cycloaddition; 1,5-disubstituted",
    rxno = "RXNO:0000269",
    target = "[nX3;+0:1]1(-[#6:6]):[nX2;+0:2]:[nX2;+0:3]:[cH1:5]:[c;H0:4](-[#6:7]):1",
    from = "[N+0:1](-[#6:6])=[N+:2]=[N-:3].[C:5]#[C:4]-[#6:7]",
    conditions = "cu",
    recipe = "Cp*RuCl(PPh3)2, dioxane or toluene, 25-80 °C",
    yield = { 70, 90 },
    cautions = { "organic azide (small ones explosive)" },
    source = "Zhang et al., J. Am. Chem. Soc. 2005, 127, 15998; from memory",
    example { "CCCCc1cnnn1Cc1ccccc1", from = { "[N-]=[N+]=NCc1ccccc1", "C#CCCCC" } },
    example { "c1ccc(Cn2nncc2-c2ccccc2)cc1", from = { "[N-]=[N+]=NCc1ccccc1", "C#Cc1ccccc1" } },
    refuse { "CCCCc1cn(Cc2ccccc2)nn1" }, -- the 1,4-isomer: copper
}

disconnection "nitrile-oxide-isoxazole" {
    about = "Isoxazole by nitrile oxide cycloaddition; 3,5-disubstituted",
    rxno = "RXNO:0000018",
    target = "[c:1]1(-[#6:6]):[nX2:2]:[o:3]:[c:4](-[#6:7]):[cH1:5]:1",
    from = "[C:1](-[#6:6])=[N:2]-[O:3].[C:4](-[#6:7])#[C:5]",
    conditions = "base-aq-mild",
    also_attacks = { "alkene", "other alkyne", "thiol", "primary amine" },
    recipe = "aldoxime, NaOCl or NCS then Et3N, CH2Cl2, 0 °C to rt",
    yield = { 65, 90 },
    cautions = { "sodium hypochlorite" },
    source = "Joule, Mills, Heterocyclic Chemistry; from memory",
    example { "COC(=O)c1cc(-c2ccc(Cl)cc2)no1", from = { "ON=Cc1ccc(Cl)cc1", "C#CC(=O)OC" } },
    example { "c1ccc(cc1)-c1cc(on1)-c1ccccc1", from = { "ON=Cc1ccccc1", "C#Cc1ccccc1" } },
    refuse { "Cc1conc1-c1ccccc1" }, -- 4-substituted, H at C5: the rare regioisomer
}

disconnection "nitrile-oxide-isoxazoline" {
    about = "Isoxazoline by nitrile oxide cycloaddition; oxygen at the more substituted carbon of a terminal alkene; syn",
    rxno = "RXNO:0000018",
    target = "[CX3:1]1(-[#6:6])=[NX2:2]-[OX2:3]-[CX4:4](-[#6:7])-[CX4;H2:5]-1",
    from = "[C:1](-[#6:6])=[N:2]-[O:3].[C:4](-[#6:7])=[C:5]",
    conditions = "base-aq-mild",
    also_attacks = { "other alkene", "alkyne", "thiol", "primary amine" },
    recipe = "aldoxime, NaOCl, CH2Cl2 or NCS then Et3N, 0 °C to rt",
    yield = { 65, 90 },
    cautions = { "sodium hypochlorite" },
    source = "Joule, Mills, Heterocyclic Chemistry; from memory",
    example { "CCOC(=O)C1CC(c2ccc(F)cc2)=NO1", from = { "ON=Cc1ccc(F)cc1", "C=CC(=O)OCC" } },
    example { "c1ccc(cc1)C1=NOC(C1)c1ccccc1", from = { "ON=Cc1ccccc1", "C=Cc1ccccc1" } },
    refuse { "CC1CON=C1c1ccccc1" }, -- 4-substituted from a terminal alkene: the rare regioisomer
}

disconnection "nitrone-cycloaddition" {
    about = "Isoxazolidine by nitrone cycloaddition; 5-substituted from a terminal alkene",
    rxno = "RXNO:0000018",
    target = "[NX3;+0:1]1(-[#6:6])-[OX2;+0:2]-[CX4:3]-[CX4;H2:4]-[CX4;H1:5]-1",
    from = "[N+:1](-[#6:6])(-[O-:2])=[C:5].[C:3]=[C:4]",
    conditions = "heat-200",
    also_attacks = { "other alkene", "alkyne", "thiol" },
    recipe = "toluene, 80-110 °C",
    yield = { 60, 85 },
    source = "Clayden, Greeves, Warren, Organic Chemistry; from memory",
    example { "CN1OC(CO)CC1c1ccccc1", from = { "C[N+]([O-])=Cc1ccccc1", "C=CCO" } },
    example { "c1ccc(cc1)C1CC(ON1c1ccccc1)c1ccccc1", from = { "[O-][N+](c1ccccc1)=Cc1ccccc1", "C=Cc1ccccc1" } },
    refuse { "C1CCON1C" }, -- unsubstituted nitrone carbon: the parent nitrone has to be made in situ from formaldehyde
}

disconnection "carbonyl-ene" {
    about = "Glyoxylate ene reaction; bond at the less substituted alkene carbon, alkene transposed",
    rxno = "RXNO:0000007",
    target = "[OX2H1:1]-[CX4;H1;$(C-C(=O)[OX2]):2]-!@[CX4;H2:3]-[CX3;H0:4]=[CX3:5]",
    from = "[O:1]=[C:2].[C:3]=[C:4]-[C:5]",
    conditions = "lewis-acid",
    also_attacks = { "other alkene", "free alcohol", "primary amine", "aldehyde" },
    recipe = "SnCl4 or Cu(OTf)2/box, CH2Cl2, -20 °C to rt",
    yield = { 60, 90 },
    cautions = { "tin(IV) chloride" },
    source = "Kürti, Czakó, Strategic Applications of Named Reactions in Organic Synthesis; from memory",
    example { "C=C(C)CC(O)C(=O)OCC", from = { "CCOC(=O)C=O", "C=C(C)C" } },
    example { "CCOC(=O)C(O)CC(=C)c1ccccc1", from = { "CCOC(=O)C=O", "CC(=C)c1ccccc1" } },
    refuse { "C=C(C)CC(O)CC" }, -- an unactivated aldehyde
}

disconnection "photocycloaddition-enone" {
    about = "[2+2] Photocycloaddition of an enone; cis or trans fusion, trans epimerises; head-to-tail with electron-rich alkenes",
    target = "[CX4;r4:1]1-[CX4;r4;$(C-[CX3;R;!r4](=O)[#6]):2]-[CX4;r4:3]-[CX4;r4:4]-1",
    from = "[C:1]=[C:2].[C:3]=[C:4]",
    conditions = "photo",
    recipe = "hν (> 300 nm), CH2Cl2 or MeCN, -78 to 25 °C, excess of the alkene",
    yield = { 50, 80 },
    source = "Carey, Sundberg, Advanced Organic Chemistry Part B; from memory",
    example { "O=C1CCCC2CCC12", from = { "O=C1C=CCCC1", "C=C" } },
    example { "O=C1CCC2CCC12", from = { "O=C1C=CCC1", "C=C" } },
    refuse { "O=C1CCC1" }, -- a cyclobutanone: ketene cycloaddition
}

disconnection "dichloroketene" {
    about = "[2+2] Cycloaddition of dichloroketene; CCl2 at the more substituted (cation-stabilising) carbon of the alkene; cis",
    target = "[CX4;r4:1]1([Cl:6])([Cl:7])-[CX3:2](=[OX1:3])-[CX4;r4:4]-[CX4;r4:5]-1",
    from = "[C:1]([Cl:6])([Cl:7])(Cl)-[C:2](=[O:3])Cl.[C:4]=[C:5]",
    conditions = "zn-acid",
    also_attacks = { "free alcohol", "primary amine", "aldehyde" },
    recipe = "Cl3CCOCl, Zn(Cu), Et2O, rt, ultrasound; or Cl2CHCOCl, Et3N",
    yield = { 60, 90 },
    cautions = { "trichloroacetyl chloride", "zinc-copper couple" },
    source = "Carey, Sundberg, Advanced Organic Chemistry Part B; from memory",
    example { "O=C1C2CC=CC2C1(Cl)Cl", from = { "O=C(Cl)C(Cl)(Cl)Cl", "C1=CCC=C1" } },
    example { "O=C1C2CCCCC2C1(Cl)Cl", from = { "O=C(Cl)C(Cl)(Cl)Cl", "C1=CCCCC1" } },
    refuse { "O=C1CCC1" }, -- no chlorines: reductive dechlorination comes after
}

disconnection "paterno-buechi" {
    about = "Paternò-Büchi reaction; oxygen at the less substituted alkene carbon (more stable 1,4-diradical)",
    rxno = "RXNO:0000083",
    target = "[OX2;r4:1]1-[CX4;r4;$(C-c):2]-[CX4;r4:3]-[CX4;r4:4]-1",
    from = "[O:1]=[C:2].[C:3]=[C:4]",
    conditions = "photo",
    also_attacks = { "other alkene", "secondary amine" },
    recipe = "hν (300-350 nm), benzene or MeCN, rt, alkene in excess",
    yield = { 40, 75 },
    cautions = { "benzene" },
    source = "Carey, Sundberg, Advanced Organic Chemistry Part B; from memory",
    example { "CC1(C)C(c2ccccc2)(c2ccccc2)OC1C", from = { "O=C(c1ccccc1)c1ccccc1", "CC=C(C)C" } },
    example { "CC1(C)C(OC1(C)C)c1ccccc1", from = { "O=Cc1ccccc1", "CC(C)=C(C)C" } },
    refuse { "C1COC1" }, -- no aryl ketone or aldehyde behind it
}

disconnection "nazarov" {
    about = "Nazarov cyclisation; conrotatory; alkene in the more substituted position",
    rxno = "RXNO:0000209",
    target = "[OX1:1]=[CX3:2]1-[CX3:3]=[CX3;H0:4]-[CX4;!H0:5]-[CX4;H1,H2:6]-1",
    from = "[O:1]=[C:2](-[C:3]=[C:4])-[C:6]=[C:5]",
    conditions = "lewis-acid",
    also_attacks = { "free alcohol", "primary amine" },
    recipe = "BF3·OEt2, AlCl3 or H3PO4/HCO2H, CH2Cl2, 0-80 °C",
    yield = { 50, 85 },
    cautions = { "boron trifluoride etherate" },
    source = "Kürti, Czakó, Strategic Applications of Named Reactions in Organic Synthesis; from memory",
    example { "CC1CC(=O)C2=C1CCCC2", from = { "CC=CC(=O)C1=CCCCC1" } },
    example { "O=C1CCC2=C1CCCC2", from = { "C=CC(=O)C1=CCCCC1" } },
    refuse { "O=C1C=CCCC1" }, -- a six-membered ring
}

disconnection "triene-electrocyclisation" {
    about = "6π Electrocyclisation of a triene; disrotatory (heat), conrotatory (light); the central alkene must be Z",
    target = "[CX3:1]1=[CX3:2]-[CX3:3]=[CX3:4]-[CX4;H0,H1:5]-[CX4;H0,H1:6]-1",
    from = "[C:6]=[C:1]-[C:2]=[C:3]-[C:4]=[C:5]",
    conditions = "heat-200",
    also_attacks = { "other diene", "thiol" },
    recipe = "toluene, 80-140 °C",
    yield = { 50, 85 },
    source = "Clayden, Greeves, Warren, Organic Chemistry; from memory",
    example { "COC(=O)C1=CC=CC(C)C1C", from = { "COC(=O)C(=CC)C=CC=CC" } },
    example { "CC1C=CC=CC1C", from = { "CC=CC=CC=CC" } },
    refuse { "C1=CCC=CC1" }, -- a 1,4-diene
}

disconnection "pauson-khand" {
    about = "Pauson-Khand reaction; bicyclo[3.3.0]octenones best; cis substituents",
    rxno = "RXNO:0000464",
    target = "[OX1;+0:1]=[CX3;+0:2]1-[CX3:3]=[CX3;x3:4]-[CX4;x3:5]-[CX4:6]-1",
    from = "([C:3]#[C:4].[C:5]=[C:6]).[C-:2]#[O+:1]",
    conditions = "heat-200",
    also_attacks = { "thiol", "other alkyne", "sulfide" },
    recipe = "Co2(CO)8, NMO, CH2Cl2, rt; or CO, [Rh(CO)2Cl]2, toluene",
    yield = { 60, 90 },
    cautions = { "dicobalt octacarbonyl", "carbon monoxide" },
    source = "Kürti, Czakó, Strategic Applications of Named Reactions in Organic Synthesis; from memory",
    example { "CCOC(=O)C1(C(=O)OCC)CC2=CC(=O)CC2C1", from = { "C#CCC(CC=C)(C(=O)OCC)C(=O)OCC", "[C-]#[O+]" } },
    example { "O=C1C=C2CCCC2C1", from = { "C#CCCCC=C", "[C-]#[O+]" } },
    refuse { "O=C1C=CCC1" }, -- intermolecular with ethylene: not this rule
}

disconnection "simmons-smith" {
    about = "Simmons-Smith cyclopropanation; syn to an allylic OH; geometry of the alkene kept",
    rxno = "RXNO:0000258",
    target = "[CX4;H2;r3:1]1-[CX4;r3;!$(C-[$([CX3]=O),$(C#N),N,n]):2]-[CX4;r3;!$(C-[$([CX3]=O),$(C#N),N,n]):3]-1",
    from = "I[C:1]I.[C:2]=[C:3]",
    conditions = "cuprate",
    also_attacks = { "primary amine", "tertiary amine", "sulfide", "other alkene" },
    recipe = "CH2I2, Et2Zn or Zn(Cu), CH2Cl2 or Et2O, 0 °C",
    yield = { 70, 95 },
    cautions = { "diethylzinc", "diiodomethane" },
    source = "Carey, Sundberg, Advanced Organic Chemistry Part B; from memory",
    example { "OCC1CC1c1ccc(OC)cc1", from = { "ICI", "OCC=Cc1ccc(OC)cc1" } },
    example { "C1CCC2CC2C1", from = { "ICI", "C1=CCCCC1" } },
    refuse { "COC(=O)C1CC1c1ccccc1" }, -- electron-poor alkenes react badly: sulfoxonium ylide
}

disconnection "dichlorocyclopropanation" {
    about = "Dichlorocarbene addition; syn; more electron-rich alkene first",
    target = "[CX4;r3:1]1([Cl:2])([Cl:3])-[CX4;r3;!$(C-[$([CX3]=O),$(C#N)]):4]-[CX4;r3;!$(C-[$([CX3]=O),$(C#N)]):5]-1",
    from = "[C:1]([Cl:2])([Cl:3])Cl.[C:4]=[C:5]",
    conditions = "base-aq-strong",
    also_attacks = { "free alcohol", "primary amine", "other alkene" },
    recipe = "CHCl3, 50 % NaOH, BnEt3NCl, 0-40 °C; also: CHBr3",
    yield = { 65, 90 },
    cautions = { "chloroform", "sodium hydroxide" },
    source = "Vogel's Textbook of Practical Organic Chemistry; from memory",
    example { "ClC1(Cl)C2CCCCC21", from = { "ClC(Cl)Cl", "C1=CCCCC1" } },
    example { "ClC1(Cl)CC1c1ccccc1", from = { "ClC(Cl)Cl", "C=Cc1ccccc1" } },
    refuse { "ClC1CC1" }, -- one chlorine only
}

disconnection "diazoacetate-cyclopropanation" {
    about = "Cyclopropanation with a diazoacetate; trans favoured",
    target = "[CX4;H1;r3:1]1(-[CX3:2](=[OX1:3])-[OX2:4]-[CX4:5])-[CX4;r3;!$(C-[$([CX3]=O),$(C#N)]):6]-[CX4;r3;!$(C-[$([CX3]=O),$(C#N)]):7]-1",
    from = "[N-]=[N+]=[C:1]-[C:2](=[O:3])-[O:4]-[C:5].[C:6]=[C:7]",
    conditions = "cu",
    also_attacks = { "free alcohol", "sulfide", "other alkene", "free acid" },
    recipe = "Rh2(OAc)4 or CuOTf, CH2Cl2, slow addition, rt",
    yield = { 60, 90 },
    cautions = { "ethyl diazoacetate" },
    source = "Carey, Sundberg, Advanced Organic Chemistry Part B; from memory",
    example { "CCOC(=O)C1CC1c1ccc(F)cc1", from = { "[N-]=[N+]=CC(=O)OCC", "C=Cc1ccc(F)cc1" } },
    example { "CCOC(=O)C1CC1c1ccccc1", from = { "[N-]=[N+]=CC(=O)OCC", "C=Cc1ccccc1" } },
    refuse { "COC(=O)C1CC1C(=O)OC" }, -- an electron-poor alkene does not react with the carbenoid
}

disconnection "corey-chaykovsky-cyclopropane" {
    about = "Corey-Chaykovsky cyclopropanation; trans",
    rxno = "RXNO:0000600",
    target = "[CX4;H2;r3:1]1-[CX4;r3:2]-[CX4;r3;$(C-[$([CX3](=O)[#6,O]),$(C#N)]):3]-1",
    from = "[C:1][S+](C)(C)=O.[I-].[C:2]=[C:3]",
    conditions = "ylide",
    also_attacks = { "alkyl halide", "free acid" },
    recipe = "Me3SOI, NaH, DMSO, rt",
    yield = { 65, 90 },
    cautions = { "sodium hydride" },
    source = "Corey, Chaykovsky, J. Am. Chem. Soc. 1965, 87, 1353; from memory",
    example { "O=C(c1ccccc1)C1CC1c1ccc(Cl)cc1", from = { "[I-].C[S+](C)(C)=O", "O=C(C=Cc1ccc(Cl)cc1)c1ccccc1" } },
    example { "O=C(c1ccccc1)C1CC1c1ccccc1", from = { "[I-].C[S+](C)(C)=O", "O=C(C=Cc1ccccc1)c1ccccc1" } },
    refuse { "C1CC1c1ccccc1" }, -- no acceptor on the alkene: Simmons-Smith
}

disconnection "corey-chaykovsky-epoxide" {
    about = "Corey-Chaykovsky epoxidation; CH2 delivered equatorially in cyclohexanones (sulfonium), axially opened epoxide with sulfoxonium",
    rxno = "RXNO:0000599",
    target = "[CX4;H2;r3:1]1-[OX2;r3:2]-[CX4;r3:3]-1-[#6:4]",
    from = "[C:1][S+](C)C.[I-].[O:2]=[C:3]-[#6:4]",
    conditions = "ylide",
    also_attacks = { "alkyl halide", "free acid", "enone" },
    recipe = "Me3SI, NaH or KOtBu, DMSO/THF, 0 °C",
    yield = { 65, 90 },
    cautions = { "sodium hydride" },
    source = "Corey, Chaykovsky, J. Am. Chem. Soc. 1965, 87, 1353; from memory",
    example { "CC(C)(C)OC(=O)N1CCC2(CC1)CO2", from = { "[I-].C[S+](C)C", "CC(C)(C)OC(=O)N1CCC(=O)CC1" } },
    example { "C1OC1c1ccccc1", from = { "[I-].C[S+](C)C", "O=Cc1ccccc1" } },
    refuse { "CC1OC1C" }, -- an internal epoxide: epoxidise the alkene
}

disconnection "ring-closing-metathesis" {
    about = "Ring-closing metathesis; Z in rings up to eight",
    rxno = "RXNO:0000245",
    target = "[CX3;H1;R1;!r3;!r4;!$(C-[CX3]);!$(C-c);!$(C-[O,N,S,F,Cl,Br,I]);!$(C-[CX3]=C):1]=;@[CX3;H0,H1;R1;!r3;!r4;!$(C-[O,N,S,F,Cl,Br,I]);!$(C-[CX3]=C):2]",
    from = "([C:1]=C.[C:2]=C)",
    conditions = "pd0",
    also_attacks = { "primary amine", "other terminal alkene" },
    recipe = "Grubbs II, CH2Cl2 or toluene, 40-80 °C, 5-50 mM",
    yield = { 70, 95 },
    cautions = { "dichloromethane" },
    source = "Carey, Sundberg, Advanced Organic Chemistry Part B; from memory",
    example { "CC(C)(C)OC(=O)N1CC=CC(C(=O)OC)C1", from = { "C=CCN(CC(C=C)C(=O)OC)C(=O)OC(C)(C)C" } },
    example { "CCOC(=O)C1(CC=CC1)C(=O)OCC", from = { "C=CCC(CC=C)(C(=O)OCC)C(=O)OCC" } },
    refuse { "C1=CCC1" }, -- strain: cyclobutenes open
}

disconnection "cross-metathesis" {
    about = "Cross metathesis with an acrylate; E (> 20:1)",
    rxno = "RXNO:0000280",
    target = "[CX4:1]/?[CX3;H1;!R:2]=[CX3;H1;!R:3]/?[CX3;$(C(=O)[#6,OX2]):4]",
    from = "[C:1]-[C:2]=C.C=[C:3]-[C:4]",
    conditions = "pd0",
    also_attacks = { "primary amine", "other terminal alkene" },
    recipe = "Hoveyda-Grubbs II (2-5 mol%), CH2Cl2, 40 °C, 2-3 equiv. acrylate",
    yield = { 65, 95 },
    cautions = { "methyl acrylate" },
    source = "Carey, Sundberg, Advanced Organic Chemistry Part B; from memory",
    example { "COC(=O)/C=C/CCCCOC(C)=O", from = { "C=CCCCCOC(C)=O", "C=CC(=O)OC" } },
    example { "CCCCCC/C=C/C(=O)OC", from = { "C=CCCCCCC", "C=CC(=O)OC" } },
    refuse { "COC(=O)/C=C\\CC" }, -- the Z isomer is not formed
}

disconnection "corey-chaykovsky-epoxide-sulfoxonium" {
    about = "Epoxide from a ketone and trimethylsulfoxonium iodide",
    target = "[CX4;H2;r3:1]1-[OX2;r3:2]-[CX4;H0;r3:3]-1",
    from = "[C:1][S+](C)(C)=O.[I-].[O:2]=[C:3]",
    conditions = "ylide",
    also_attacks = { "alkyl halide", "aldehyde", "free acid", "acyl halide", "enone" },
    recipe = "Me3SOI, NaOH or KOH, toluene with Bu4NBr or DMSO, rt to 60 °C",
    yield = { 60, 88 },
    source = "Corey, Chaykovsky, J. Am. Chem. Soc. 1965, 87, 1353; from memory",
    example { "Fc1ccc(c(F)c1)C1(Cn2cncn2)CO1", from = { "[I-].C[S+](C)(C)=O", "O=C(Cn1cncn1)c1ccc(F)cc1F" } },
    example { "CC1(CO1)c1ccccc1", from = { "[I-].C[S+](C)(C)=O", "CC(=O)c1ccccc1" } },
    refuse { "CC1OC1C" }, -- an internal epoxide
}

disconnection "diels-alder-endo-ring" {
    about = "Diels-Alder reaction of a cyclic diene with maleic anhydride or an imide: endo",
    rxno = "RXNO:0000006",
    target = "[O:8]=[C:7]1[OX2,NX3:9][C:10](=[O:11])[C@H:6]2[C@@H:5]1[C@H:4]1[CX3:3]=[CX3:2][C@@H:1]2[CX4:12]1",
    from = "[C:1]1=[C:2]-[C:3]=[C:4]-[C:12]-1.[CH:5]1-[C:7](=[O:8])-[*:9]-[C:10](=[O:11])-[CH:6]=1",
    conditions = "heat-200",
    also_attacks = { "other diene", "primary amine", "thiol", "free alcohol" },
    recipe = "Et2O or toluene, 0-25 °C",
    yield = { 85, 98 },
    cautions = { "maleic anhydride" },
    source = "Clayden, Greeves, Warren, Organic Chemistry; from memory",
    example { "O=C1OC(=O)[C@H]2[C@@H]1[C@H]1C=C[C@@H]2C1", from = { "C1=CCC=C1", "O=C1C=CC(=O)O1" } },
    refuse { "O=C1OC(=O)[C@H]2[C@@H]1[C@@H]1C=C[C@H]2C1" }, -- exo
}
