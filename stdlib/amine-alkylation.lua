-- Carbon-nitrogen bonds: alkylation, ring closure, ureas and guanidines.
-- Yields are typical ranges and sources stand from memory unless a source says otherwise.

pack {
    name = "amine-alkylation",
    version = "0.1.0",
    licence = "CC0-1.0",
    about = "Carbon-nitrogen bonds: alkylation, ring closure, ureas and guanidines",
    needs = { "synthons" },
}

disconnection "benzhydryl-amine" {
    about = "Benzhydrylation of an amine by a diarylmethyl halide",
    target = "[NX3;!$(N-[C,S]=[O,S,N]);!$(N-[N,O]);!$(N-c):1]-!@[CX4;H1:2]([c:3])[c:4]",
    cut = { 2, 1 },
    acceptor = { 2, "secondary-halide" },
    donor = { 1, "amine" },
    conditions = "alkylation",
    also_attacks = { "other alkyl halide", "acyl halide", "thiol", "phenol", "other secondary amine" },
    recipe = "K2CO3, KI (cat.), MeCN or toluene, reflux; excess of a diamine for monoalkylation",
    yield = { 60, 88 },
    source = "Kleemann and Engel, Pharmaceutical Substances; from memory",
    example { "Clc1ccc(cc1)C(c1ccccc1)N1CCNCC1", from = { "ClC(c1ccccc1)c1ccc(Cl)cc1", "C1CNCCN1" } },
    example { "c1ccc(cc1)C(c1ccccc1)N1CCOCC1", from = { "BrC(c1ccccc1)c1ccccc1", "C1COCCN1" } },
    refuse { "CN(C)C(C)c1ccccc1" }, -- one aryl group only
}

disconnection "diarylamine-alkylation" {
    about = "N-Alkylation of a diarylamine (phenothiazine, iminodibenzyl, carbazole type)",
    target = "[NX3;H0:1]([c:2])([c:3])-!@[CX4;H2,H3:4]",
    cut = { 4, 1 },
    acceptor = { 4, "alkyl" },
    donor = { 1, "amine" },
    conditions = "base-hindered",
    also_attacks = { "free acid", "alcohol", "phenol", "ester", "ketone", "alkyl halide" },
    recipe = "NaNH2 or NaH, toluene, reflux, or KOH, DMSO; basic chloride in toluene",
    yield = { 65, 92 },
    cautions = { "sodium amide" },
    source = "Kleemann and Engel, Pharmaceutical Substances; from memory",
    example { "CN(C)CCCN1c2ccccc2CCc2ccccc12", from = { "CN(C)CCCCl", "C1Cc2ccccc2Nc2ccccc12" } },
    example { "CN(C)CCCN1c2ccccc2Sc2ccc(Cl)cc12", from = { "CN(C)CCCCl", "Clc1ccc2Sc3ccccc3Nc2c1" } },
    refuse { "CN(c1ccccc1)C(C)=O" }, -- an amide nitrogen
}

disconnection "amino-ketone-from-halo-ketone" {
    about = "α-Amino ketone from an α-halo ketone and an amine",
    target = "[NX3;!$(N-[C,S]=[O,S,N]);!$(N-[N,O]);!$(N-c);$(N-[#6;!$(C=O)]):1]-!@[CX4;H1,H2:2]-[CX3:3](=[OX1:4])-[c:5]",
    cut = { 2, 1 },
    acceptor = { 2, "secondary-halide" },
    donor = { 1, "amine" },
    conditions = "amine-rt",
    also_attacks = { "other alkyl halide", "acyl halide", "thiol", "aldehyde" },
    recipe = "excess amine or K2CO3, MeCN, EtOH or NMP, 0-60 °C",
    yield = { 60, 88 },
    source = "Kleemann and Engel, Pharmaceutical Substances; from memory",
    example { "CNCC(=O)c1ccc(O)c(O)c1", from = { "CN", "O=C(CCl)c1ccc(O)c(O)c1" } },
    example { "CC(NC(C)(C)C)C(=O)c1cccc(Cl)c1", from = { "CC(C)(C)N", "CC(Br)C(=O)c1cccc(Cl)c1" } },
    refuse { "CC(=O)NCC(=O)c1ccccc1" }, -- an amide nitrogen
}

disconnection "eschweiler-clarke-twice" {
    about = "Dimethylation of a primary amine with formaldehyde and formic acid",
    target = "[CX4;!H3:1][NX3;H0:2](-!@[CH3:3])-!@[CH3:4]",
    from = "[C:1][N:2].[C:3]=O.[C:4]=O",
    conditions = "reductive-amination",
    also_attacks = { "acetal", "tert-butyl ester", "Boc amine", "thiol", "phenol" },
    recipe = "HCHO (aq.), HCO2H, 80-100 °C; also: HCHO, NaBH(OAc)3",
    yield = { 75, 95 },
    cautions = { "formaldehyde", "formic acid" },
    source = "Kürti and Czakó, Strategic Applications of Named Reactions in Organic Synthesis; from memory",
    example { "COc1ccc(cc1)C(CN(C)C)C1(O)CCCCC1", from = { "COc1ccc(cc1)C(CN)C1(O)CCCCC1", "C=O", "C=O" } },
    example { "CN(C)CCc1ccccc1", from = { "NCCc1ccccc1", "C=O", "C=O" } },
    refuse { "CN(C)C(C)=O" }, -- an amide nitrogen
}

disconnection "reductive-amination-keto-ester" {
    about = "Reductive amination of an α-keto acid or ester",
    target = "[NX3;H1;!$(N-[C,S]=[O,S,N]);!$(N-[N,O]):1]([CX4:6])-!@[CX4;H1:2]([CX4:3])[CX3:4](=[OX1:5])[OX2:7]",
    from = "[N:1][C:6].O=[C:2]([C:3])[C:4](=[O:5])[O:7]",
    conditions = "reductive-amination",
    also_attacks = { "aldehyde", "other ketone" },
    recipe = "NaBH3CN, EtOH, 4 Å sieves, or H2, Raney nickel; new centre under substrate control",
    yield = { 55, 85 },
    cautions = { "sodium cyanoborohydride" },
    source = "Patchett et al., Nature 1980, 288, 280; from memory",
    example { "CCOC(=O)C(CCc1ccccc1)NC(C)C(=O)N1CCCC1C(=O)O",
        from = { "CC(N)C(=O)N1CCCC1C(=O)O", "CCOC(=O)C(=O)CCc1ccccc1" } },
    example { "CC(NCc1ccccc1)C(=O)O", from = { "NCc1ccccc1", "CC(=O)C(=O)O" } },
    refuse { "CCOC(=O)C(C)(C)NC" }, -- quaternary carbon
}

disconnection "cyclic-amine-from-amino-ketone" {
    about = "Ring closure of an amino ketone by reductive amination; five- or six-membered ring",
    target = "[NX3;r5,r6;+0;!$(N-[C,S]=[O,S,N]);!$(N-[N,O]);!$(N-c):1]-;@[CX4;H1;r5,r6;$(C-!@c),$(C-!@[CX4;!R]):2]",
    from = "([N:1].[C:2]=O)",
    conditions = "reductive-amination",
    also_attacks = { "aldehyde", "other ketone" },
    recipe = "NaBH4 or NaBH3CN, MeOH, via the cyclic imine; also: H2, Pd/C",
    yield = { 65, 92 },
    source = "March's Advanced Organic Chemistry; from memory",
    example { "CN1CCCC1c1cccnc1", from = { "CNCCCC(=O)c1cccnc1" } },
    example { "CC1CCCN1", from = { "CC(=O)CCCN" } },
    refuse { "CC(=O)N1CCCC1C" }, -- an amide nitrogen
}

disconnection "cyclic-amine-from-amino-alcohol" {
    about = "Ring closure of an amino alcohol by activation of the hydroxyl group; five- or six-membered ring",
    target = "[NX3;r5,r6;+0;!$(N-[C,S]=[O,S,N]);!$(N-[N,O]):1]-;@[CX4;H2,H1;r5,r6;!$(C-[#7,#8,#16]~[CX3]=O);$([CH]-!@c):2]",
    from = "([N:1].[C:2]O)",
    conditions = "socl2",
    also_attacks = { "other alcohol", "free acid", "other primary amine" },
    recipe = "SOCl2 or HBr, then base; also: MsCl, Et3N; PPh3, DIAD",
    yield = { 60, 88 },
    cautions = { "thionyl chloride" },
    source = "March's Advanced Organic Chemistry; from memory",
    example { "CN1CCCC1c1cccnc1", from = { "CNCCCC(O)c1cccnc1" } },
    example { "C1CC(NC1)c1ccccc1", from = { "NCCCC(O)c1ccccc1" } },
    refuse { "O=C1CCCN1C" }, -- a lactam
}

disconnection "dithiocarbamate" {
    about = "Dithiocarbamic acid (salt) from a secondary amine and carbon disulfide",
    target = "[NX3;H0:1]([CX4:5])([CX4:6])-[CX3:2](=[SX1:3])-[SX2;H1:4]",
    from = "[N:1]([C:5])[C:6].[C:2](=[S:3])=[S:4]",
    conditions = "base-aq-mild",
    also_attacks = { "alkyl halide", "other amine" },
    recipe = "CS2, NaOH, water, 0 °C",
    yield = { 85, 98 },
    cautions = { "carbon disulfide" },
    source = "Vogel's Textbook of Practical Organic Chemistry; from memory",
    example { "CCN(CC)C(=S)S", from = { "CCNCC", "S=C=S" } },
    example { "CN(C)C(=S)S", from = { "CNC", "S=C=S" } },
    refuse { "CC(=S)S" }, -- a dithio acid
}

disconnection "carbamoyl-chloride" {
    about = "Carbamoyl chloride from a secondary amine and phosgene",
    target = "[NX3;H0:1]([#6;c,CX4:5])([#6;c,CX4:6])-[CX3:2](=[OX1:3])[Cl:4]",
    from = "[N:1]([#6:5])[#6:6].[C:2](=[O:3])(Cl)[Cl:4]",
    conditions = "acylation",
    also_attacks = { "primary amine", "alcohol", "phenol", "thiol", "free acid" },
    recipe = "phosgene or triphosgene, pyridine, toluene, 0-80 °C",
    yield = { 80, 95 },
    cautions = { "phosgene" },
    source = "March's Advanced Organic Chemistry; from memory",
    example { "O=C(Cl)N1c2ccccc2C=Cc2ccccc12", from = { "C1=Cc2ccccc2Nc2ccccc12", "ClC(Cl)=O" } },
    example { "CN(C)C(=O)Cl", from = { "CNC", "ClC(Cl)=O" } },
    refuse { "CNC(=O)Cl" }, -- loses HCl to the isocyanate
}

disconnection "urea-from-carbamoyl-chloride" {
    about = "Urea from a carbamoyl chloride and an amine",
    target = "[NX3;H0:1]([#6;c,CX4:5])([#6;c,CX4:6])-[CX3:2](=[OX1:3])-!@[NX3:4]",
    from = "[N:1]([#6:5])([#6:6])-[C:2](=[O:3])Cl.[N:4]",
    conditions = "amine-rt",
    also_attacks = { "other acyl halide", "other amine" },
    recipe = "NH3 or amine, EtOH or CH2Cl2, 0 °C to reflux",
    yield = { 80, 97 },
    source = "Kleemann and Engel, Pharmaceutical Substances; from memory",
    example { "NC(=O)N1c2ccccc2C=Cc2ccccc12", from = { "O=C(Cl)N1c2ccccc2C=Cc2ccccc12", "N" } },
    example { "CN(C)C(=O)N1CCCCC1", from = { "CN(C)C(=O)Cl", "C1CCNCC1" } },
    refuse { "CNC(=O)NC" }, -- the carbamoyl chloride would lose HCl
}

disconnection "urea-from-cyanate" {
    about = "Urea from an amine and cyanate (isocyanic acid)",
    target = "[NX3;!$(N(C=O)C=O);!$(N-[N,O,S]):1](-[#6;c,CX4:5])-[CX3:2](=[OX1:3])-[NX3;H2:4]",
    from = "[N:1]-[#6:5].[N:4]=[C:2]=[O:3]",
    conditions = "acid-aq-mild",
    also_attacks = { "other primary amine", "thiol" },
    recipe = "KOCN or NaOCN, aq. AcOH, rt to 60 °C",
    yield = { 70, 92 },
    source = "Vogel's Textbook of Practical Organic Chemistry; from memory",
    example { "NC(=O)N1c2ccccc2C=Cc2ccccc12", from = { "C1=Cc2ccccc2Nc2ccccc12", "N=C=O" } },
    example { "NC(=O)Nc1ccccc1", from = { "Nc1ccccc1", "N=C=O" } },
    refuse { "CNC(=O)NC" }, -- two substituted nitrogens
}

disconnection "thiourea-from-thiocyanate" {
    about = "Monoarylthiourea from an aniline and ammonium thiocyanate",
    target = "[NX3;H1:1](-[c:2])-[CX3:3](=[SX1:4])-[NX3;H2:5]",
    from = "[N:1]-[c:2].[S-:4][C:3]#[N:5].[NH4+]",
    conditions = "acid-aq-strong",
    also_attacks = { "acetal", "Boc carbamate" },
    recipe = "NH4SCN, HCl, water, reflux; also: benzoyl isothiocyanate, then NaOH",
    yield = { 65, 88 },
    source = "Frank, Smith, Org. Synth. Coll. Vol. 3, 735; from memory",
    example { "NC(=S)Nc1c(Cl)cccc1Cl", from = { "Nc1c(Cl)cccc1Cl", "[NH4+].[S-]C#N" } },
    example { "NC(=S)Nc1ccccc1", from = { "Nc1ccccc1", "[NH4+].[S-]C#N" } },
    refuse { "CNC(N)=S" }, -- alkylamines give the thiocyanate salt
}

disconnection "isothiourea-s-methylation" {
    about = "S-Methylation of a thiourea",
    target = "[CX4;H3:1][SX2:2]-[CX3:3](=[NX2:4])-[NX3:5]",
    from = "[C:1]I.[S:2]=[C:3]([N:4])[N:5]",
    conditions = "alkylation",
    also_attacks = { "amine", "thiol", "phenol" },
    recipe = "MeI, MeOH or acetone, reflux; hydroiodide",
    yield = { 85, 98 },
    cautions = { "iodomethane" },
    source = "Vogel's Textbook of Practical Organic Chemistry; from memory",
    example { "CSC(=N)Nc1c(Cl)cccc1Cl", from = { "CI", "NC(=S)Nc1c(Cl)cccc1Cl" } },
    example { "CSC(N)=N", from = { "CI", "NC(N)=S" } },
    refuse { "CSC(C)=N" }, -- a thioimidate
}

disconnection "aminoimidazoline" {
    about = "2-Amino-2-imidazoline from an S-methylisothiourea and a 1,2-diamine",
    target = "[NX3;H1:1](-[c:8])-[CX3:2]1=[NX2:4]-[CX4:5]-[CX4:6]-[NX3;H1:7]-1",
    from = "[N:1](-[c:8])-[C:2](=N)SC.[N:7][C:6][C:5][N:4]",
    conditions = "amine-heat",
    also_attacks = { "ester", "alkyl halide", "acyl halide" },
    recipe = "ethylenediamine, MeOH or amyl alcohol, 100-150 °C",
    yield = { 55, 80 },
    source = "Kleemann and Engel, Pharmaceutical Substances; from memory",
    example { "Clc1cccc(Cl)c1NC1=NCCN1", from = { "CSC(=N)Nc1c(Cl)cccc1Cl", "NCCN" } },
    example { "C1CN=C(N1)Nc1ccccc1", from = { "CSC(=N)Nc1ccccc1", "NCCN" } },
    refuse { "C1CN=CN1" }, -- no exocyclic nitrogen
}

disconnection "cyanoisothiourea" {
    about = "N-Cyano-S-methylisothiourea or nitroketene S,N-acetal from the dithio compound and one amine",
    target = "[CH3:8][SX2:7]-[CX3:1](-[NX3;H1:2][CX4:3])=[$([NX2]-C#N),$([CX3;H1]-[N+](=O)[O-]):4]",
    from = "[C:8][S:7][C:1](SC)=[*:4].[N:2][C:3]",
    conditions = "amine-rt",
    also_attacks = { "other primary amine", "alkyl halide", "acyl halide" },
    recipe = "EtOH or MeCN, rt, one equivalent of amine; methanethiol escapes",
    yield = { 70, 92 },
    cautions = { "methanethiol" },
    source = "Kleemann and Engel, Pharmaceutical Substances; from memory",
    example { "CSC(=NC#N)NCCSCc1nc[nH]c1C", from = { "CSC(SC)=NC#N", "NCCSCc1nc[nH]c1C" } },
    example { "CNC(SC)=C[N+](=O)[O-]", from = { "CSC(SC)=C[N+](=O)[O-]", "CN" } },
    refuse { "CSC(=N)NC" }, -- no acceptor on the carbon
}

disconnection "cyanoguanidine-second-amine" {
    about = "Cyanoguanidine or nitroketene aminal from the S-methyl compound and an amine",
    target = "[NX3;H1:5]([CX4:6])-[CX3:1](-[NX3;H1:2][CX4:3])=[$([NX2]-C#N),$([CX3;H1]-[N+](=O)[O-]):4]",
    from = "[N:5][C:6].CS[C:1](-[N:2][C:3])=[*:4]",
    conditions = "amine-heat",
    also_attacks = { "other primary amine", "alkyl halide", "acyl halide" },
    recipe = "EtOH or water, rt to reflux; methanethiol escapes",
    yield = { 70, 92 },
    cautions = { "methanethiol" },
    source = "Kleemann and Engel, Pharmaceutical Substances; from memory",
    example { "CNC(=NC#N)NCCSCc1nc[nH]c1C", from = { "CN", "CSC(=NC#N)NCCSCc1nc[nH]c1C" } },
    example { "CNC(=C[N+](=O)[O-])NC", from = { "CN", "CNC(SC)=C[N+](=O)[O-]" } },
    refuse { "CNC(=N)NC" }, -- no acceptor on the carbon
}

disconnection "biguanide" {
    about = "Biguanide from an amine and dicyandiamide",
    target = "[#6:1][NX3:2]-[CX3:3](=[NX2;H1:4])-[NX3;H1:5]-[CX3:6](=[NX2;H1:7])[NX3;H2:8]",
    from = "[#6:1][N:2].[N:4]#[C:3]-[N:5]-[C:6](=[N:7])[N:8]",
    conditions = "heat-200",
    also_attacks = { "ester", "acyl halide", "other primary amine" },
    recipe = "amine hydrochloride, dicyandiamide, neat or xylene, 120-160 °C",
    yield = { 65, 90 },
    source = "Werner, Bell, J. Chem. Soc., Trans. 1922, 121, 1790; from memory",
    example { "CN(C)C(=N)NC(=N)N", from = { "CNC", "N#CNC(=N)N" } },
    example { "N=C(N)NC(=N)NCCc1ccccc1", from = { "NCCc1ccccc1", "N#CNC(=N)N" } },
    refuse { "CN(C)C(=N)N" }, -- a guanidine
}

interconversion "glyoxylamide-reduction" {
    about = "Tryptamine by reduction of an indole-3-glyoxylamide",
    target = "[c;$(c1c[nX3]c2ccccc12):1][CX4;H2:2][CX4;H2:3][NX3;!$(N-[C,S]=O):4]",
    from = "[c:1][C:2](=O)[C:3](=O)[N:4]",
    conditions = "lialh4",
    also_attacks = { "aldehyde", "ketone", "ester", "free acid", "nitrile", "nitro", "epoxide" },
    recipe = "LiAlH4, THF or dioxane, reflux",
    yield = { 65, 90 },
    cautions = { "lithium aluminium hydride" },
    source = "Speeter, Anthony, J. Am. Chem. Soc. 1954, 76, 6208; from memory",
    example { "CN(C)CCc1c[nH]c2ccccc12", from = { "CN(C)C(=O)C(=O)c1c[nH]c2ccccc12" } },
    example { "C(CN1CCCC1)c1c[nH]c2ccccc12", from = { "O=C(C(=O)c1c[nH]c2ccccc12)N1CCCC1" } },
    refuse { "CN(C)CCc1ccccc1" }, -- not an indole
}

disconnection "n-amino-hydrazone" {
    about = "Hydrazone of an aldehyde with an N-amino hydantoin, oxazolidinone or the like",
    target = "[NX3;R;$(N-[CX3;R]=[OX1]):1]-[NX2:2]=[CX3;H1:3]",
    from = "[N:1]-[N:2].O=[C:3]",
    conditions = "acid-aq-mild",
    also_attacks = { "other aldehyde", "ketone", "acyl halide" },
    recipe = "aq. EtOH or AcOH, cat. acid, rt to reflux",
    yield = { 80, 97 },
    source = "Kleemann and Engel, Pharmaceutical Substances; from memory",
    example { "O=C1CN(N=Cc2ccc([N+](=O)[O-])o2)C(=O)N1", from = { "NN1CC(=O)NC1=O", "O=Cc1ccc([N+](=O)[O-])o1" } },
    example { "O=C1OCCN1N=Cc1ccco1", from = { "NN1CCOC1=O", "O=Cc1ccco1" } },
    refuse { "CN(C)N=Cc1ccccc1" }, -- a simple hydrazine
}

disconnection "haloamide-amine-branched" {
    about = "Amine from an α-chloro or α-bromo amide at a secondary carbon",
    target = "[NX3;!$(N-[C,S]=[O,S,N]);!$(N-c);!$(N-[N,O]):1]-!@[CX4;H1:2](-[CX4:5])-[CX3:3](=[OX1:4])-[NX3:6]",
    cut = { 2, 1 },
    acceptor = { 2, "secondary-halide" },
    donor = { 1, "amine" },
    conditions = "amine-heat",
    also_attacks = { "other primary amine", "other alkyl halide", "acyl halide", "thiol", "free acid" },
    recipe = "amine (2-3 equiv.), K2CO3, MeCN or toluene, 80 °C; KI with the chloride",
    yield = { 60, 85 },
    source = "Kleemann and Engel, Pharmaceutical Substances; from memory",
    example { "CCCNC(C)C(=O)Nc1ccccc1C", from = { "CCCN", "CC(Br)C(=O)Nc1ccccc1C" } },
    example { "CC(N1CCOCC1)C(=O)Nc1ccccc1", from = { "C1COCCN1", "CC(Br)C(=O)Nc1ccccc1" } },
    refuse { "CC(NC(C)=O)C(=O)N(C)C" }, -- an amide nitrogen
}

disconnection "amino-ester-from-halo-ester" {
    about = "Amine from an α-halo ester at a benzylic or secondary carbon",
    target = "[NX3;!$(N-[C,S]=[O,S,N]);!$(N-c);!$(N-[N,O]):1]-!@[CX4;H1:2](-[#6;c,CX4:5])-[CX3:3](=[OX1:4])-[OX2;H0:6]",
    cut = { 2, 1 },
    acceptor = { 2, "secondary-halide" },
    donor = { 1, "amine" },
    conditions = "alkylation",
    also_attacks = { "other primary amine", "other alkyl halide", "acyl halide", "thiol", "phenol",
        "free acid" },
    recipe = "K2CO3 or NaHCO3, MeCN, MeOH or DMF, rt to 60 °C; racemic",
    yield = { 60, 88 },
    source = "Kleemann and Engel, Pharmaceutical Substances; from memory",
    example { "COC(=O)C(c1ccccc1Cl)N1CCc2sccc2C1", from = { "C1CNCc2ccsc12", "COC(=O)C(Br)c1ccccc1Cl" } },
    example { "CCOC(=O)C(C)N1CCOCC1", from = { "C1COCCN1", "CCOC(=O)C(C)Br" } },
    refuse { "COC(=O)C(C)NC(C)=O" }, -- an amide nitrogen
}

disconnection "primary-carbamate" {
    about = "Primary carbamate from an alcohol and cyanate (or chlorosulfonyl isocyanate)",
    target = "[CX4:1][OX2:2]-[CX3:3](=[OX1:4])-[NX3;H2:5]",
    from = "[C:1][O:2].[N:5]=[C:3]=[O:4]",
    conditions = "acid-dry-strong",
    also_attacks = { "primary amine", "other alcohol", "acetal", "Boc amine" },
    recipe = "NaOCN, CF3CO2H, CH2Cl2 or toluene; also: ClSO2NCO, then water",
    yield = { 70, 92 },
    source = "Loev, Kormendy, J. Org. Chem. 1963, 28, 3421; from memory",
    example { "CCCC(C)(COC(N)=O)CO", from = { "CCCC(C)(CO)CO", "N=C=O" } },
    example { "NC(=O)OCc1ccccc1", from = { "OCc1ccccc1", "N=C=O" } },
    refuse { "CCOC(=O)NC" }, -- a substituted nitrogen
}

disconnection "trityl-azole" {
    about = "N-Tritylation of imidazole, triazole or another azole",
    target = "[n;X3;+0;r5:1]-!@[CX4;H0:2](-[c:3])(-[c:4])-[c:5]",
    cut = { 2, 1 },
    acceptor = { 2, "secondary-halide" },
    donor = { 1, "azole" },
    conditions = "alkylation",
    also_attacks = { "primary amine", "thiol", "other azole NH", "primary alcohol" },
    recipe = "Et3N or K2CO3, MeCN or DMF, rt to 60 °C",
    yield = { 75, 95 },
    source = "Kleemann and Engel, Pharmaceutical Substances; from memory",
    example { "Clc1ccccc1C(c1ccccc1)(c1ccccc1)n1ccnc1",
        from = { "ClC(c1ccccc1)(c1ccccc1)c1ccccc1Cl", "c1c[nH]cn1" } },
    example { "c1ccc(cc1)C(c1ccccc1)(c1ccccc1)n1ccnc1", from = { "ClC(c1ccccc1)(c1ccccc1)c1ccccc1", "c1c[nH]cn1" } },
    refuse { "CC(C)(C)n1ccnc1" }, -- a tertiary alkyl halide eliminates
}

disconnection "leuckart-formamide" {
    about = "Formamide from a ketone by the Leuckart reaction",
    target = "[CX4;H1:1]([#6;c,CX4:2])([#6;c,CX4:3])-[NX3;H1:4]-[CX3;H1:5]=[OX1:6]",
    from = "[C:1](=O)([#6:2])[#6:3].[N:4]-[C:5]=[O:6]",
    conditions = "heat-200",
    also_attacks = { "aldehyde", "ester", "imine", "nitro" },
    recipe = "formamide or ammonium formate, HCO2H, 160-185 °C",
    yield = { 60, 85 },
    cautions = { "formic acid", "formamide" },
    source = "Ingersoll, Org. Synth. Coll. Vol. 2, 503; from memory",
    example { "CC(NC=O)c1ccc(Br)cc1", from = { "CC(=O)c1ccc(Br)cc1", "NC=O" } },
    example { "O=CNC1CCCCC1", from = { "O=C1CCCCC1", "NC=O" } },
    refuse { "CCNC=O" }, -- a primary carbon
}
