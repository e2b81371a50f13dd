-- Ethers, epoxides and sulfur compounds.
-- Yields are typical ranges and sources stand from memory unless a source says otherwise.

pack {
    name = "ethers-thio",
    version = "0.1.0",
    licence = "CC0-1.0",
    about = "Ethers, epoxides and sulfur compounds",
    needs = { "synthons" },
}

-- Acceptors that activate ortho and para positions for SNAr.
local ACTIVATE = "[$([N+](=O)[O-]),$([CX3]=O),$(C#N),$(S(=O)=O)]"

disconnection "williamson-ether" {
    about = "Williamson ether synthesis; SN2 at the primary carbon; put the halide on the less hindered half",
    rxno = "RXNO:0000090",
    target = "[C;X4;H2:1]([#6;!$([C;X4;H0]):4])-!@[O;X2:2]-!@[C;X4;!$(C([#8])[#7,#8,#16]):3]",
    cut = { 1, 2 },
    acceptor = { 1, "alkyl" },
    donor = { 2, "alcohol" },
    conditions = "alkylation",
    also_attacks = { "alkyl halide", "acyl halide", "epoxide", "ester", "ketone", "primary amide",
        "primary amine", "secondary amine", "free alcohol", "phenol", "thiol", "free acid" },
    recipe = "NaH, DMF or THF, 0 °C to rt; also: I, OTs, OMs",
    yield = { 65, 90 },
    cautions = { "sodium hydride", "N,N-dimethylformamide" },
    source = "Warren and Wyatt, Organic Synthesis: The Disconnection Approach; from memory",
    example { "CCCCOC1CCN(CC1)C(=O)OC(C)(C)C", from = { "CCCCBr", "OC1CCN(CC1)C(=O)OC(C)(C)C" } },
    refuse { "CC(C)(C)OC(C)(C)C" }, -- tertiary halide eliminates; no primary carbon to attack
}

disconnection "aryl-alkyl-ether" {
    about = "Alkylation of a phenol (Williamson ether synthesis); O- not C-alkylation in polar aprotic solvent; phenol before alcohol",
    rxno = "RXNO:0000090",
    target = "[c;!$(c:[nX2]):3][O;X2:2]-!@[C;X4;H3,$([C;H2][#6;!$([C;X4;H0])]);!$(C([#8])[#7,#8,#16]):1]",
    cut = { 1, 2 },
    acceptor = { 1, "alkyl" },
    donor = { 2, "phenol" },
    conditions = "alkylation",
    also_attacks = { "alkyl halide", "acyl halide", "thiol", "free acid", "primary amine",
        "secondary amine" },
    recipe = "K2CO3, acetone or DMF, 20-60 °C; also: I, Cl with NaI, OTs, OMs",
    yield = { 75, 95 },
    cautions = { "N,N-dimethylformamide" },
    source = "Clayden, Greeves, Warren, Organic Chemistry; from memory",
    example { "COC(=O)c1ccc(OCc2ccccn2)cc1", from = { "COC(=O)c1ccc(O)cc1", "BrCc1ccccn1" } },
    refuse { "COc1ncccn1" }, -- a 2-pyridone and its kin take the alkyl group on nitrogen
    refuse { "CC(C)(C)Oc1ccccc1" }, -- tertiary halide eliminates
}

disconnection "mitsunobu-aryl-ether" {
    about = "Mitsunobu reaction (aryl ether); inversion at the carbinol carbon",
    rxno = "RXNO:0000034",
    target = "[c:3][O;X2:2]-!@[C@;X4;H1:1]([C:4])[C:5]",
    from = "[c:3][O;X2;H1:2].[O;H1][C@@;X4;H1:1]([C:4])[C:5]",
    conditions = "mitsunobu",
    also_attacks = { "free alcohol", "free acid", "phenol", "thiol", "sulfonamide" },
    recipe = "PPh3, DIAD or DEAD, THF, 0 °C to rt",
    yield = { 60, 90 },
    cautions = { "diisopropyl azodicarboxylate", "triphenylphosphine" },
    source = "O. Mitsunobu, Synthesis 1981, 1; from memory",
    example { "COC(=O)[C@@H](C)Oc1ccc(Cl)cc1", from = { "COC(=O)[C@H](C)O", "Oc1ccc(Cl)cc1" } },
    refuse { "CC(C)(C)Oc1ccccc1" }, -- tertiary alcohol does not take part in SN2
}

disconnection "epoxide-opening-by-amine" {
    about = "Epoxide opening by an amine; opens at the less substituted carbon with inversion there; configuration of C-O kept; bis-alkylation is the rival of a primary amine",
    target = "[C;X4;H1:1]([#6:5])([O;X2;H1:2])[C;X4;H2:3]-!@[N;X3;+0;!$(N[C,S]=[O,S,N]):4]",
    cut = { 3, 4 },
    acceptor = { 3, "oxirane" },
    donor = { 4, "amine" },
    conditions = "amine-heat",
    also_attacks = { "primary amine", "secondary amine", "thiol", "acyl halide", "alkyl halide" },
    recipe = "amine (excess), EtOH or iPrOH, reflux; also: LiClO4 or Yb(OTf)3",
    yield = { 60, 90 },
    source = "Warren and Wyatt, Organic Synthesis: The Disconnection Approach; from memory",
    example { "CC(C)NCC(O)COc1cccc2ccccc12", from = { "C1OC1COc1cccc2ccccc12", "CC(C)N" } },
    refuse { "CC(=O)NCC(O)C" }, -- amide nitrogen is not nucleophilic enough
}

disconnection "epoxide-opening-by-phenoxide" {
    about = "Epoxide opening by a phenol; opens at the less substituted carbon with inversion there; configuration of C-O kept",
    target = "[C;X4;H1:1]([#6:5])([O;X2;H1:2])[C;X4;H2:3]-!@[O;X2:4][c:6]",
    cut = { 3, 4 },
    acceptor = { 3, "oxirane" },
    donor = { 4, "phenol" },
    conditions = "base-aq-mild",
    also_attacks = { "alkyl halide", "acyl halide", "thiol", "primary amine", "epoxide" },
    recipe = "K2CO3 or NaH (cat), DMF, 60-100 °C",
    yield = { 65, 90 },
    cautions = { "sodium hydride", "N,N-dimethylformamide" },
    source = "Warren and Wyatt, Organic Synthesis: The Disconnection Approach; from memory",
    example { "CC(=O)Nc1ccc(OCC(O)CN2CCOCC2)cc1", from = { "C1OC1CN1CCOCC1", "CC(=O)Nc1ccc(O)cc1" } },
    refuse { "OCC(C)Oc1ccccc1" }, -- phenoxide goes to the terminal carbon
}

disconnection "epoxide-opening-by-alkoxide" {
    about = "Epoxide opening by an alkoxide; opens at the less substituted carbon with inversion there; configuration of C-O kept",
    target = "[C;X4;H1:1]([#6:5])([O;X2;H1:2])[C;X4;H2:3]-!@[O;X2:4][C;X4;H3,H2:6]",
    cut = { 3, 4 },
    acceptor = { 3, "oxirane" },
    donor = { 4, "alcohol" },
    conditions = "alkoxide",
    also_attacks = { "alkyl halide", "acyl halide", "ester", "ketone", "aldehyde" },
    recipe = "NaOMe or NaH, MeOH (alcohol as solvent), reflux",
    yield = { 65, 90 },
    cautions = { "sodium methoxide", "sodium hydride" },
    source = "Clayden, Greeves, Warren, Organic Chemistry; from memory",
    example { "COCC(O)Cc1ccc(Br)cc1", from = { "C1OC1Cc1ccc(Br)cc1", "CO" } },
    refuse { "OCC(OC)Cc1ccc(Br)cc1" }, -- base opens at the terminal carbon; the primary alcohol needs acid and a tertiary or benzylic carbon
}

disconnection "epoxide-opening-by-cyanide" {
    about = "Epoxide opening by cyanide; opens at the less substituted carbon with inversion there; configuration of C-O kept",
    target = "[C;X4;H1:1]([#6:5])([O;X2;H1:2])[C;X4;H2:3][C;X2;+0:4]#[N:6]",
    cut = { 3, 4 },
    acceptor = { 3, "oxirane" },
    donor = { 4, "cyanide" },
    conditions = "cyanide",
    also_attacks = { "alkyl halide", "aldehyde", "acyl halide", "epoxide" },
    recipe = "NaCN, EtOH-H2O, pH 8-10, rt to 50 °C; also: KCN, MgSO4; TMSCN, KCN",
    yield = { 60, 85 },
    cautions = { "sodium cyanide" },
    source = "Larock, Comprehensive Organic Transformations; from memory",
    example { "N#CCC(O)COc1ccccc1", from = { "C1OC1COc1ccccc1", "[C-]#N.[Na+]" } },
    refuse { "N#CC(C)(O)COc1ccccc1" }, -- cyanohydrin: comes from a ketone
}

disconnection "thioether-from-thiol" {
    about = "Thioether by S-alkylation of a thiol; inversion; thiol before amine, alcohol and acid",
    target = "[C;X4;H3,$([C;H2][#6;!$([C;X4;H0])]);!$(C([#16])[#7,#8,#16]):1]-!@[S;X2:2]-!@[#6;!$(C=[O,S,N]):3]",
    cut = { 1, 2 },
    acceptor = { 1, "alkyl" },
    donor = { 2, "thiol" },
    conditions = "alkylation",
    also_attacks = { "alkyl halide", "acyl halide", "epoxide", "enone" },
    recipe = "K2CO3 or NaOH (2 equiv for an acid), DMF or EtOH, rt; also: Cl, I, OTs",
    yield = { 75, 95 },
    cautions = { "sodium hydroxide", "N,N-dimethylformamide" },
    source = "Warren and Wyatt, Organic Synthesis: The Disconnection Approach; from memory",
    example { "OC(=O)c1ccccc1SCc1ccc(F)cc1", from = { "BrCc1ccc(F)cc1", "OC(=O)c1ccccc1S" } },
    refuse { "CC(C)(C)Sc1ccccc1" }, -- tertiary halide eliminates
}

interconversion "sulfoxide-from-thioether" {
    about = "Oxidation of a thioether to a sulfoxide; stops at the sulfoxide with one equivalent; racemic at sulfur; sulfone is the rival",
    target = "[#6:1][S;X3;+0:2](=[O;X1])[#6:3]",
    from = "[#6:1][S;X2:2][#6:3]",
    conditions = "mcpba",
    also_attacks = { "alkene", "tertiary amine", "thiol", "thioether", "primary amine" },
    recipe = "mCPBA (1.0 equiv), CH2Cl2, -20 to 0 °C; also: NaIO4, MeOH-H2O; H2O2, AcOH",
    yield = { 75, 92 },
    cautions = { "3-chloroperbenzoic acid" },
    source = "Carey and Sundberg, Advanced Organic Chemistry, Part B; from memory",
    example { "COc1ccc2[nH]c(nc2c1)S(=O)Cc1ncc(C)c(OC)c1C", from = { "COc1ccc2[nH]c(nc2c1)SCc1ncc(C)c(OC)c1C" } },
    refuse { "CS(=O)(=O)c1ccccc1" }, -- sulfone, two oxygens on sulfur
}

interconversion "sulfone-from-thioether" {
    about = "Oxidation of a thioether to a sulfone; two oxygen atoms",
    target = "[#6:1][S;X4:2](=[O;X1])(=[O;X1])[#6:3]",
    from = "[#6:1][S;X2:2][#6:3]",
    conditions = "mcpba",
    also_attacks = { "alkene", "tertiary amine", "thiol", "thioether", "aldehyde", "primary amine" },
    recipe = "Oxone, MeOH-H2O, rt; also: mCPBA (2.2 equiv); H2O2, Na2WO4 (cat)",
    yield = { 80, 97 },
    cautions = { "potassium peroxymonosulfate" },
    source = "Larock, Comprehensive Organic Transformations; from memory",
    example { "CS(=O)(=O)c1ccc(cc1)C(=O)O", from = { "CSc1ccc(cc1)C(=O)O" } },
    refuse { "NS(=O)(=O)c1ccccc1" }, -- sulfonamide: second substituent on sulfur is nitrogen
}

disconnection "sulfonamide" {
    about = "Sulfonamide from a sulfonyl chloride and an amine; secondary amine clean; primary amine can be sulfonylated twice",
    target = "[#6:1][S;X4:2](=[O;X1:4])(=[O;X1:5])-!@[N;X3;!$(NC=[O,S,N]);!$(N(S)S):3]",
    cut = { 2, 3 },
    acceptor = { 2, "sulfonyl" },
    donor = { 3, "amine" },
    conditions = "acylation",
    also_attacks = { "primary amine", "secondary amine", "phenol", "thiol", "free alcohol" },
    recipe = "Et3N or pyridine, CH2Cl2, 0 °C to rt",
    yield = { 80, 97 },
    cautions = { "pyridine" },
    source = "Clayden, Greeves, Warren, Organic Chemistry; from memory",
    example { "CCOc1ccc(cc1C(=O)OC)S(=O)(=O)N1CCN(C)CC1", from = { "CCOc1ccc(cc1C(=O)OC)S(=O)(=O)Cl", "CN1CCNCC1" } },
    refuse { "COS(=O)(=O)c1ccccc1" }, -- sulfonate ester, no S-N bond
}

disconnection "phenol-methylation" {
    about = "Methylation of a phenol with iodomethane (Williamson ether synthesis); phenol before alcohol; chelated ortho OH reacts last",
    rxno = "RXNO:0000090",
    also = { "phenol-methylation-dimethyl-sulfate" },
    target = "[c;!$(c:[nX2]):1][O;X2:2]-!@[C;X4;H3:3]",
    cut = { 3, 2 },
    acceptor = { 3, "methyl" },
    donor = { 2, "phenol" },
    conditions = "alkylation",
    also_attacks = { "free acid", "thiol", "primary amine", "secondary amine", "tertiary amine",
        "active methylene", "NH azole" },
    recipe = "K2CO3, MeI, acetone or DMF, rt to reflux",
    yield = { 85, 97 },
    cautions = { "iodomethane", "N,N-dimethylformamide" },
    source = "Vogel's Textbook of Practical Organic Chemistry; from memory",
    example { "COc1ccc(C=O)c(F)c1", from = { "O=Cc1ccc(O)cc1F", "CI" } },
    refuse { "COc1ncccn1" }, -- a 2-pyridone and its kin take the methyl group on nitrogen
    refuse { "COC(C)=O" }, -- a methyl ester
}

interconversion "sulfinic-acid-from-sulfonyl-chloride" {
    about = "Sulfinic acid by reduction of a sulfonyl chloride; kept as the sodium salt",
    target = "[#6:1][S;X3:2](=[O:3])[O;H1:4]",
    from = "[#6:1][S:2](=[O:3])(=[O;H0:4])Cl",
    conditions = "zn-acid",
    also_attacks = { "aldehyde", "alkyl halide", "acyl halide", "enone", "disulfide", "quinone" },
    recipe = "Na2SO3, NaHCO3, H2O, 60-80 °C, then acid",
    yield = { 75, 92 },
    source = "Vogel's Textbook of Practical Organic Chemistry; from memory",
    example { "CC(=O)Nc1ccc(cc1)S(=O)O", from = { "CC(=O)Nc1ccc(cc1)S(=O)(=O)Cl" } },
    refuse { "CS(C)=O" }, -- a sulfoxide
}

disconnection "sulfone-by-snar" {
    about = "Sulfone from a sulfinate and an activated aryl chloride; ipso",
    target = "[c;$(c:c-[$([N+](=O)[O-]),$(C#N),$(S(=O)=O)]),$(c1:c:c:c(-" .. ACTIVATE ..
        "):c:c:1):1]-!@[S;X4:2](=[O:3])(=[O:4])[#6:5]",
    from = "[c:1]Cl.[S;X3:2](=[O:3])([O;H1:4])[#6:5]",
    conditions = "base-aq-mild",
    also_attacks = { "other activated aryl halide", "alkyl halide", "acyl halide", "enone" },
    recipe = "sodium sulfinate, ethylene glycol or DMSO, 100-140 °C; also: aryl fluoride",
    yield = { 60, 85 },
    cautions = { "dimethyl sulfoxide" },
    source = "Kleemann and Engel, Pharmaceutical Substances; from memory",
    example { "CC(=O)Nc1ccc(cc1)S(=O)(=O)c1ccc(cc1)[N+](=O)[O-]", from = { "O=[N+]([O-])c1ccc(Cl)cc1", "CC(=O)Nc1ccc(cc1)S(=O)O" } },
    refuse { "CS(=O)(=O)c1ccccc1" }, -- no acceptor on the ring
}

interconversion "epoxide-from-halohydrin" {
    about = "Epoxide from a halohydrin; inversion at the carbon that bears halogen; anti arrangement needed",
    target = "[C;X4;H1;r3:1]1([#6:4])[O;X2;r3:2][C;X4;H2;r3:3]1",
    from = "[C;X4;H1:1]([#6:4])([O;X2;H1:2])[C;X4;H2:3][Br;X1]",
    conditions = "base-aq-strong",
    also_attacks = { "alkyl halide", "acyl halide", "ester" },
    recipe = "K2CO3, MeOH or NaOH, H2O, rt; also: Cl, I, OTs",
    yield = { 80, 95 },
    cautions = { "sodium hydroxide" },
    source = "Clayden, Greeves, Warren, Organic Chemistry; from memory",
    example { "Clc1ccc(cc1)C1CO1", from = { "OC(CBr)c1ccc(Cl)cc1" } },
    refuse { "C1COC1" }, -- four-membered ring, not an epoxide
}

disconnection "benzhydryl-ether" {
    about = "Ether from a diarylmethyl halide and an alcohol; SN1-prone, weak base is enough",
    target = "[c][CX4;H1:1]([c])-!@[OX2:2]-[CX4:3]",
    cut = { 1, 2 },
    acceptor = { 1, "alkyl" },
    donor = { 2, "alcohol" },
    conditions = "alkylation",
    also_attacks = { "primary amine", "secondary amine", "thiol", "other alcohol" },
    recipe = "K2CO3, MeCN or neat, 80-120 °C",
    yield = { 60, 85 },
    source = "Rieveschl, US 2421714; from memory",
    example { "CN(C)CCOC(c1ccccc1)c1ccccc1", from = { "BrC(c1ccccc1)c1ccccc1", "CN(C)CCO" } },
    refuse { "CCOC(C)(C)c1ccccc1" }, -- a tertiary benzylic halide eliminates
}

disconnection "epoxide-opening-by-azide" {
    about = "Epoxide opening by azide; opens at the less substituted carbon with inversion there; configuration of C-O kept",
    target = "[C;X4;H1:1]([#6:5])([O;X2;H1:2])[C;X4;H2:3][N;X2;+0:4]=[N;+:6]=[N;-:7]",
    from = "[C;X4;H1:1]1([#6:5])[O;X2;H0:2][C;X4;H2:3]1.[N;-:4]=[N;+:6]=[N;-:7].[Na+]",
    conditions = "alkylation",
    also_attacks = { "alkyl halide", "epoxide" },
    recipe = "NaN3, NH4Cl, MeOH-H2O, 60 °C",
    yield = { 75, 95 },
    cautions = { "sodium azide" },
    source = "Larock, Comprehensive Organic Transformations; from memory",
    example { "OC(CN=[N+]=[N-])COc1ccccc1", from = { "C1OC1COc1ccccc1", "[Na+].[N-]=[N+]=[N-]" } },
    example { "OC(CN=[N+]=[N-])c1ccccc1", from = { "C1OC1c1ccccc1", "[Na+].[N-]=[N+]=[N-]" } },
    refuse { "OCC(N=[N+]=[N-])COc1ccccc1" }, -- azide goes to the terminal carbon, so the primary alcohol is a minor isomer
}

disconnection "epoxide-opening-acid-alcohol" {
    about = "Acid-catalysed epoxide opening by an alcohol; attack at the more substituted carbon with inversion",
    target = "[C;X4;H0:1]([C;X4:5])([C;X4:6])([O;X2:4][C;X4;H3,H2:7])[C;X4;H2:3][O;X2;H1:2]",
    from = "[C;X4;H0:1]1([C;X4:5])([C;X4:6])[O;X2;H0:2][C;X4;H2:3]1.[O;X2;H1:4][C;X4:7]",
    conditions = "acid-dry-strong",
    also_attacks = { "silyl ether", "alkene" },
    recipe = "H2SO4 or camphorsulfonic acid (cat), MeOH, 0 °C to rt; also: BF3·OEt2",
    yield = { 65, 85 },
    cautions = { "sulfuric acid" },
    source = "Clayden, Greeves, Warren, Organic Chemistry; from memory",
    example { "COC1(CO)CCCCC1", from = { "C1CCC2(CC1)CO2", "CO" } },
    example { "COC(C)(C)CO", from = { "CC1(C)CO1", "CO" } },
    refuse { "COCC(O)(C)C" }, -- in acid the alcohol attacks the tertiary carbon, not CH2
}

disconnection "epoxide-opening-by-thiolate" {
    about = "Epoxide opening by a thiol; opens at the less substituted carbon with inversion there; configuration of C-O kept",
    target = "[C;X4;H1:1]([#6:5])([O;X2;H1:2])[C;X4;H2:3]-!@[S;X2:4][#6;!$(C=[O,S,N]):6]",
    cut = { 3, 4 },
    acceptor = { 3, "oxirane" },
    donor = { 4, "thiol" },
    conditions = "base-aq-mild",
    also_attacks = { "alkyl halide", "enone", "primary amine" },
    recipe = "Et3N or K2CO3, MeOH or MeCN, rt",
    yield = { 75, 95 },
    source = "Larock, Comprehensive Organic Transformations; from memory",
    example { "CCCCC(O)CSc1ccc(Cl)cc1", from = { "CCCCC1CO1", "Sc1ccc(Cl)cc1" } },
    example { "OC(CSc1ccccc1)c1ccccc1", from = { "C1OC1c1ccccc1", "Sc1ccccc1" } },
    refuse { "CCCCC(CO)Sc1ccccc1" }, -- thiolate goes to the terminal carbon
}

disconnection "heteroaryl-benzyl-thioether" {
    about = "S-Alkylation of a heteroarenethiol with a benzylic chloride; S before N",
    target = "[c;$(c~n):3]-!@[S;X2:2]-!@[C;X4;H2:1][c:4]",
    cut = { 1, 2 },
    acceptor = { 1, "alkyl" },
    donor = { 2, "thiol" },
    conditions = "alkylation",
    also_attacks = { "alkyl halide", "epoxide" },
    recipe = "NaOH, EtOH-H2O, rt to 50 °C",
    yield = { 80, 95 },
    cautions = { "sodium hydroxide" },
    source = "Warren and Wyatt, Organic Synthesis: The Disconnection Approach; from memory",
    example { "COc1ccc2[nH]c(nc2c1)SCc1ncc(C)c(OC)c1C", from = { "COc1ccc2[nH]c(S)nc2c1", "ClCc1ncc(C)c(OC)c1C" } },
    example { "C(Sc1nc2ccccc2[nH]1)c1ccccc1", from = { "ClCc1ccccc1", "Sc1nc2ccccc2[nH]1" } },
    refuse { "c1ccccc1SCc1ccccc1" }, -- arenethiol, no heteroaromatic thione tautomer (use the general rule)
}

interconversion "thiol-via-thiourea" {
    about = "Thiol from an alkyl halide and thiourea; inversion; no dialkyl sulfide (unlike NaSH)",
    target = "[C;X4;H2:1]([#6;!$([C;X4;H0]):3])[S;X2;H1:2]",
    from = "[C;X4;H2:1]([#6:3])[Br;X1].[N;H2][C;X3]([N;H2])=[S;X1;H0:2]",
    conditions = "alkylation",
    also_attacks = { "alkyl halide", "ester" },
    recipe = "thiourea, EtOH, reflux, then NaOH, H2O; also: Cl, I, OTs",
    yield = { 70, 90 },
    cautions = { "sodium hydroxide" },
    source = "Clayden, Greeves, Warren, Organic Chemistry; from memory",
    example { "SCc1ccc(Br)cc1", from = { "BrCc1ccc(Br)cc1", "NC(N)=S" } },
    example { "CCCCCCCCCCCCS", from = { "CCCCCCCCCCCCBr", "NC(N)=S" } },
    refuse { "Sc1ccc(Br)cc1" }, -- aryl halide does not undergo this SN2
}

disconnection "thioacetate-displacement" {
    about = "Thioacetate displacement with inversion; inversion",
    target = "[C@;X4;H1:1]([C;X4:4])([C;X4:5])-!@[S;X2:2][C;X3:3](=[O;X1:6])[C;H3:7]",
    from = "[C@@;X4;H1:1]([C;X4:4])([C;X4:5])[O;X2][S;X4](=O)(=O)[C;H3].[S;X2;H1:2][C;X3:3](=[O;X1:6])[C;H3:7]",
    conditions = "alkylation",
    also_attacks = { "alkyl halide", "epoxide", "enone" },
    recipe = "KSAc or AcSH, Cs2CO3, DMF, 50-70 °C; also: OTs, Br",
    yield = { 65, 90 },
    cautions = { "N,N-dimethylformamide" },
    source = "Larock, Comprehensive Organic Transformations; from memory",
    example { "CC(=O)S[C@@H]1CN(C(=O)OC(C)(C)C)[C@H](C(=O)OC)C1",
        from = { "CS(=O)(=O)O[C@H]1CN(C(=O)OC(C)(C)C)[C@H](C(=O)OC)C1", "CC(=O)S" } },
    example { "CC(=O)SC1CCCCC1", from = { "CS(=O)(=O)OC1CCCCC1", "CC(=O)S" } },
    refuse { "CC(=O)SC(C)(C)C" }, -- tertiary centre does not take part in SN2
}

disconnection "disulfide-from-thiol" {
    about = "Oxidative coupling of a thiol to a symmetrical disulfide; symmetrical disulfides only",
    target = "[#6:1][S;X2:2]-!@[S;X2:3][#6:4]",
    from = "[#6:1][S;X2;H1:2].[S;X2;H1:3][#6:4]",
    when = function(m) return m.atom[2].symmetry == m.atom[3].symmetry end,
    conditions = "br2",
    also_attacks = { "phosphine" },
    recipe = "I2, Et3N, MeOH, rt; also: air, DMSO, H2O2",
    yield = { 85, 98 },
    cautions = { "iodine" },
    source = "Larock, Comprehensive Organic Transformations; from memory",
    example { "Clc1ccc(cc1)SSc1ccc(Cl)cc1", from = { "Sc1ccc(Cl)cc1", "Sc1ccc(Cl)cc1" } },
    example { "C(SSCc1ccccc1)c1ccccc1", from = { "SCc1ccccc1", "SCc1ccccc1" } },
    refuse { "CSSc1ccccc1" }, -- unsymmetrical disulfide would come with both symmetrical ones; the two halves must be equal
}

interconversion "sulfonyl-chloride-from-thiol" {
    about = "Sulfonyl chloride by oxidative chlorination of a thiol; also from disulfides and benzyl thioethers",
    target = "[#6:1][S;X4:2](=[O;X1])(=[O;X1])[Cl;X1]",
    from = "[#6:1][S;X2;H1:2]",
    conditions = "br2",
    also_attacks = { "aldehyde" },
    recipe = "NCS, 2 M HCl, MeCN, 0-10 °C; also: Cl2, AcOH-H2O; from the benzyl thioether",
    yield = { 60, 90 },
    cautions = { "N-chlorosuccinimide", "chlorine", "hydrochloric acid" },
    source = "Larock, Comprehensive Organic Transformations; from memory",
    example { "N#Cc1ccc(cc1)S(=O)(=O)Cl", from = { "N#Cc1ccc(S)cc1" } },
    example { "O=S(=O)(Cl)Cc1ccccc1", from = { "SCc1ccccc1" } },
    refuse { "OS(=O)(=O)c1ccccc1" }, -- sulfonic acid, no S-Cl bond
}

disconnection "triethylsilyl-ether" {
    about = "Silylation of an alcohol (triethylsilyl); primary before secondary before tertiary",
    target = "[C;X4:1][O;X2:2][Si;X4:3]([C;H2:4][C;H3:5])([C;H2:6][C;H3:7])[C;H2:8][C;H3:9]",
    from = "[C;X4:1][O;X2;H1:2].[Cl;X1][Si;X4:3]([C;H2:4][C;H3:5])([C;H2:6][C;H3:7])[C;H2:8][C;H3:9]",
    conditions = "silylation",
    also_attacks = { "free acid", "thiol", "primary amine" },
    recipe = "TESCl, imidazole, DMF or CH2Cl2; also: TESOTf, 2,6-lutidine, -78 °C (tertiary alcohols)",
    yield = { 85, 98 },
    cautions = { "N,N-dimethylformamide" },
    source = "Wuts, Greene's Protective Groups in Organic Synthesis; from memory",
    example { "CC[Si](CC)(CC)OC(C)(C)C#Cc1ccccc1", from = { "OC(C)(C)C#Cc1ccccc1", "CC[Si](Cl)(CC)CC" } },
    example { "CC[Si](CC)(CC)OC1CCCCC1", from = { "OC1CCCCC1", "CC[Si](Cl)(CC)CC" } },
    refuse { "CC[Si](CC)(CC)Cc1ccccc1" }, -- C-Si, not O-Si
}

interconversion "dimethyl-acetal-formation" {
    about = "Acetal formation from an aldehyde and methanol; equilibrium: remove water",
    target = "[C;X4;H1:1]([#6:5])([O;X2:2][C;H3:6])[O;X2:3][C;H3:7]",
    from = "[C;X3;H1:1]([#6:5])=[O;X1].[O;X2;H1:2][C;H3:6].[O;X2;H1:3][C;H3:7]",
    conditions = "acid-hot-dry",
    recipe = "TsOH (cat), HC(OMe)3, MeOH, rt to reflux",
    yield = { 80, 97 },
    source = "Clayden, Greeves, Warren, Organic Chemistry; from memory",
    example { "COC(OC)c1ccc(Br)cc1", from = { "O=Cc1ccc(Br)cc1", "CO", "CO" } },
    example { "COC(OC)c1ccccc1", from = { "O=Cc1ccccc1", "CO", "CO" } },
    refuse { "COC(OC)OC" }, -- orthoester carbon bears three oxygens
}

disconnection "vinylogous-ester" {
    about = "3-Alkoxy enone from a 1,3-diketone; two isomers from an unsymmetrical dione",
    target = "[C;X4:1][O;X2:2][C;X3:3]=[C;X3;H1:4][C;X3:5](=[O:6])[#6:7]",
    from = "[C:1][O;H1:2].O=[C:3][C;H2:4][C:5](=[O:6])[#6:7]",
    conditions = "acid-hot-dry",
    recipe = "TsOH, ROH, benzene or toluene, reflux with water removal; also: TiCl4/ROH, Me2SO4/K2CO3, MeI",
    yield = { 80, 95 },
    source = "Carey and Sundberg, Advanced Organic Chemistry, Part B; from memory",
    example { "CC(C)COC1=CC(=O)CC(c2ccccc2)C1", from = { "CC(C)CO", "O=C1CC(=O)CC(c2ccccc2)C1" } },
    example { "CCOC1=CC(=O)CCC1", from = { "CCO", "O=C1CCCC(=O)C1" } },
    refuse { "COC1=CCCCC1" }, -- no ketone: a simple enol ether
}

disconnection "heteroaryl-s-methylation" {
    about = "S-Methylation of a cyclic thiourea or thioamide; sulfur before nitrogen; precursor written as the thiol, it exists as the thione",
    target = "[n;X2:4]:[c;r6:1]-[S;X2:2]-!@[C;X4;H3:3]",
    cut = { 3, 2 },
    acceptor = { 3, "methyl" },
    donor = { 2, "thiol" },
    conditions = "alkylation",
    also_attacks = { "tertiary amine" },
    recipe = "NaOH, MeI, H2O/MeOH, rt; also: K2CO3/DMF, Me2SO4, benzyl chloride",
    yield = { 80, 95 },
    cautions = { "iodomethane", "sodium hydroxide" },
    source = "Joule and Mills, Heterocyclic Chemistry; from memory",
    example { "CSc1nc(cc(=O)[nH]1)-c1ccccc1", from = { "O=c1cc(-c2ccccc2)nc(S)[nH]1", "CI" } },
    example { "CSc1ccccn1", from = { "Sc1ccccn1", "CI" } },
    refuse { "CSc1ccccc1" }, -- no ring nitrogen next to the carbon
}

disconnection "thioether-from-activated-alcohol" {
    about = "Thioether from a diarylcarbinol and a thiol; SN1, racemic",
    target = "[c:1][C;X4;H1:2]([c:3])-!@[S;X2:4][#6:5]",
    from = "[c:1][C:2]([c:3])O.[S;H1:4][#6:5]",
    conditions = "acid-dry-strong",
    also_attacks = { "other thiol", "alkene" },
    recipe = "CF3CO2H, rt; also: H2SO4/AcOH, BF3·OEt2; trityl alcohol likewise",
    yield = { 80, 95 },
    cautions = { "trifluoroacetic acid" },
    source = "Kleemann and Engel, Pharmaceutical Substances; from memory",
    example { "OC(=O)CSC(c1ccccc1)c1ccc(F)cc1", from = { "OC(c1ccccc1)c1ccc(F)cc1", "OC(=O)CS" } },
    example { "OC(=O)CSC(c1ccccc1)c1ccccc1", from = { "OC(c1ccccc1)c1ccccc1", "OC(=O)CS" } },
    refuse { "CCSCc1ccccc1" }, -- only one aryl group: cation too poor
}

disconnection "sulfone-by-alkylation" {
    about = "Sulfone by alkylation of a sulfinate; sulfur, not oxygen",
    target = "[#6:1][S;X4:2](=[O:3])(=[O:4])-!@[C;X4;H2:5][#6:6]",
    from = "[#6:1][S;X3:2](=[O:3])[O;H1:4].Br[C:5][#6:6]",
    conditions = "alkylation",
    also_attacks = { "other alkyl halide", "enone", "epoxide" },
    recipe = "sodium sulfinate, DMF, 60-80 °C; also: alkyl chloride, iodide, tosylate",
    yield = { 75, 93 },
    cautions = { "methyl bromoacetate", "N,N-dimethylformamide" },
    source = "Larock, Comprehensive Organic Transformations; from memory",
    example { "COC(=O)CS(=O)(=O)c1ccc(F)cc1", from = { "O=S(O)c1ccc(F)cc1", "COC(=O)CBr" } },
    example { "O=S(=O)(Cc1ccccc1)c1ccccc1", from = { "O=S(O)c1ccccc1", "BrCc1ccccc1" } },
    refuse { "CC(C)(C)S(=O)(=O)c1ccccc1" }, -- tertiary halide eliminates
}

disconnection "methyl-sulfone-from-sulfinate" {
    about = "Methyl sulfone from a sulfinate and iodomethane; sulfur, not oxygen",
    target = "[c:1][S;X4:2](=[O:3])(=[O:4])-!@[C;X4;H3:5]",
    from = "[c:1][S;X3:2](=[O:3])[O;H1:4].I[C:5]",
    conditions = "alkylation",
    also_attacks = { "tertiary amine" },
    recipe = "sodium sulfinate, MeI, DMF, 40 °C; also: Me2SO4, ClCH2CO2H then decarboxylation",
    yield = { 75, 92 },
    cautions = { "iodomethane", "N,N-dimethylformamide" },
    source = "Larock, Comprehensive Organic Transformations; from memory",
    example { "CS(=O)(=O)c1ccc(C(C)=O)c(Br)c1", from = { "CC(=O)c1ccc(cc1Br)S(=O)O", "CI" } },
    example { "CS(=O)(=O)c1ccccc1", from = { "O=S(O)c1ccccc1", "CI" } },
    refuse { "CS(=O)c1ccccc1" }, -- a sulfoxide
}

disconnection "aryl-benzyl-ether-secondary" {
    about = "Aryl ether of a secondary benzylic carbon from the chloride",
    target = "[c:1][OX2:2]-!@[CX4;H1;$(C(-c)[CX4]):3]",
    cut = { 3, 2 },
    acceptor = { 3, "secondary-halide" },
    donor = { 2, "phenol" },
    conditions = "alkylation",
    also_attacks = { "other alkyl halide", "acyl halide", "thiol", "free acid", "primary amine",
        "secondary amine" },
    recipe = "K2CO3 or NaOH, DMF or MeCN, KI (cat.), 50-80 °C; elimination competes",
    yield = { 50, 78 },
    source = "Kleemann and Engel, Pharmaceutical Substances; from memory",
    example { "CN(C)CCC(Oc1ccc(cc1)C(F)(F)F)c1ccccc1", from = { "CN(C)CCC(Cl)c1ccccc1", "Oc1ccc(cc1)C(F)(F)F" } },
    example { "CC(Oc1ccccc1)c1ccccc1", from = { "CC(Br)c1ccccc1", "Oc1ccccc1" } },
    refuse { "CC(C)Oc1ccccc1" }, -- not benzylic
}

disconnection "snar-alkoxide-trifluoromethyl" {
    about = "Aryl ether from an alkoxide and a halobenzotrifluoride",
    target = "[c;$(c1ccc(C(F)(F)F)cc1),$(c1c(C(F)(F)F)cccc1):1]-!@[OX2:2]-[CX4:3]",
    cut = { 1, 2 },
    acceptor = { 1, "activated-aryl" },
    donor = { 2, "alcohol" },
    conditions = "base-hindered",
    also_attacks = { "ester", "ketone", "aldehyde", "free acid", "primary amide", "thiol", "phenol" },
    recipe = "NaH or KOtBu, DMSO, DMF or NMP, 60-100 °C",
    yield = { 65, 90 },
    cautions = { "sodium hydride" },
    source = "Kleemann and Engel, Pharmaceutical Substances; from memory",
    example { "CNCCC(Oc1ccc(cc1)C(F)(F)F)c1ccccc1", from = { "Clc1ccc(cc1)C(F)(F)F", "CNCCC(O)c1ccccc1" } },
    example { "CC(C)Oc1ccc(cc1)C(F)(F)F", from = { "Fc1ccc(cc1)C(F)(F)F", "CC(C)O" } },
    refuse { "COc1cccc(C(F)(F)F)c1" }, -- meta to the trifluoromethyl group
}

disconnection "hetarylmethyl-thioether" {
    about = "Thioether from an electron-rich hetarylmethanol and a thiol in acid",
    target = "[c;$(c1nc[nH]c1),$(c1[nH]cnc1),$(c1ccco1),$(c1ccc(C)o1),$(c1ccc[nH]1):1]-[CX4;H2:2]-!@[SX2:3]-[CX4:4]",
    from = "[c:1]-[C:2][OH].[S:3]-[C:4]",
    conditions = "acid-aq-strong",
    also_attacks = { "other alcohol", "acetal", "Boc carbamate", "tert-butyl ester" },
    recipe = "conc. HCl or HBr, 0 °C (furans) to reflux (imidazoles)",
    yield = { 65, 90 },
    cautions = { "hydrochloric acid" },
    source = "Kleemann and Engel, Pharmaceutical Substances; from memory",
    example { "NCCSCc1nc[nH]c1C", from = { "OCc1nc[nH]c1C", "NCCS" } },
    example { "CN(C)Cc1ccc(CSCCN)o1", from = { "CN(C)Cc1ccc(CO)o1", "NCCS" } },
    refuse { "CSCc1ccccc1" }, -- a plain benzyl group
}

disconnection "bis-sulfonamide" {
    about = "Both sulfonyl chlorides of a molecule to primary sulfonamides",
    target = "([SX4:1](=[OX1:5])(=[OX1:6])(-[c:7])-[NX3;H2:2].[SX4:3](=[OX1:8])(=[OX1:9])(-[c:10])-[NX3;H2:4])",
    from = "([S:1](=[O:5])(=[O:6])(-[c:7])Cl.[S:3](=[O:8])(=[O:9])(-[c:10])Cl).[N:2].[N:4]",
    conditions = "amine-rt",
    also_attacks = { "acyl halide", "alkyl halide", "activated ester" },
    recipe = "conc. aq. NH3, 0 °C to reflux",
    yield = { 75, 92 },
    cautions = { "ammonia" },
    source = "Kleemann and Engel, Pharmaceutical Substances; from memory",
    example { "Nc1cc(Cl)c(cc1S(N)(=O)=O)S(N)(=O)=O", from = { "Nc1cc(Cl)c(cc1S(=O)(=O)Cl)S(=O)(=O)Cl", "N", "N" } },
    refuse { "Cc1ccc(cc1)S(N)(=O)=O" }, -- one sulfonyl group only
}
