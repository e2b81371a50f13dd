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
    target = "[c:3][O;X2:2]-!@[C;X4;H3,$([C;H2][#6;!$([C;X4;H0])]);!$(C([#8])[#7,#8,#16]):1]",
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
    target = "[c:1][O;X2:2]-!@[C;X4;H3:3]",
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
