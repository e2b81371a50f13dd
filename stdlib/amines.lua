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
    example { "CC(N)Cc1ccccc1", from = { "CC(=O)Cc1ccccc1", "N" } },
    refuse { "CC(C)(C)N" }, -- tertiary alkylamine: no H on the amine carbon
}

interconversion "nitroalkane-reduction" {
    about = "Reduction of a nitroalkane to an amine; hydroxylamine is the intermediate; gamma-nitro esters " ..
        "close to lactams on standing",
    rxno = "RXNO:0000337",
    target = "[C;X4;$(C[C;H2][C;H2]C=O),$([C;H2]Cc),$([C;H0](C)(C)C):1][N;X3;H2;+0:2]",
    from = "[C;X4:1][N;X3;H0;+:2](=[O;X1])[O;X1;-]",
    conditions = "h2-raney",
    also_attacks = { "nitro", "azide", "alkene", "alkyne", "imine", "aldehyde" },
    recipe = "H2, Raney Ni, MeOH; also: Zn, AcOH; NaBH4, NiCl2",
    yield = { 75, 95 },
    cautions = { "hydrogen", "nickel (Raney)" },
    source = "Larock, Comprehensive Organic Transformations; from memory",
    example { "CC(C)(N)CCC(=O)OC", from = { "CC(C)([N+](=O)[O-])CCC(=O)OC" } },
    example { "NCCc1ccccc1", from = { "[O-][N+](=O)CCc1ccccc1" } },
    refuse { "CC(=O)N" }, -- amide nitrogen
}

disconnection "ritter-reaction" {
    about = "Ritter reaction; tertiary cations; rearranged isomers where a better cation can form",
    rxno = "RXNO:0000058",
    target = "[C;X4;H0:1]([C:2])([C:3])([C:4])-[N;X3;H1:5]-[C;X3:6](=[O;X1])[#6:8]",
    from = "[C;X4;H0:1]([C:2])([C:3])([C:4])[O;X2;H1].[N;X1;H0:5]#[C;X2:6][#6:8]",
    conditions = "acid-dry-strong",
    also_attacks = { "alkene", "acetal", "silyl ether", "tert-butyl ester", "Boc amine", "epoxide",
        "free alcohol" },
    recipe = "H2SO4, AcOH or neat nitrile, 0 °C to rt; also: the alkene",
    yield = { 65, 90 },
    cautions = { "sulfuric acid" },
    source = "Kürti and Czakó, Strategic Applications of Named Reactions in Organic Synthesis; from memory",
    example { "CC(=O)NC12CC3CC(CC(C3)C1)C2", from = { "OC12CC3CC(CC(C3)C1)C2", "CC#N" } },
    example { "CC(=O)NC(C)(C)C", from = { "CC(C)(C)O", "CC#N" } },
    refuse { "CCNC(C)=O" }, -- primary carbocation is not formed
}

disconnection "aniline-n-methylation" {
    about = "Aniline N-alkylation (monomethylation by formaldehyde); monomethylation through the aminal; " ..
        "dimethyl compound is the rival",
    rxno = "RXNO:0000341",
    target = "[c:1][N;X3;H1:2]-!@[C;X4;H3:3]",
    cut = { 3, 2 },
    acceptor = { 3, "alkylidene" },
    donor = { 2, "amine" },
    conditions = "reductive-amination",
    also_attacks = { "aldehyde", "ketone", "acyl halide", "primary amine" },
    recipe = "(CH2O)n, NaOMe, MeOH, reflux, then NaBH4; also: NaBH3CN",
    yield = { 70, 90 },
    cautions = { "formaldehyde", "sodium borohydride", "sodium methoxide" },
    source = "Larock, Comprehensive Organic Transformations; from memory",
    example { "CNc1ccc(cc1)C(=O)OC", from = { "Nc1ccc(cc1)C(=O)OC", "C=O" } },
    example { "CNc1ccccc1", from = { "Nc1ccccc1", "C=O" } },
    refuse { "CNCc1ccccc1" }, -- nitrogen not on the arene
}

disconnection "quaternisation" {
    about = "Menshutkin reaction; SN2: methyl, benzyl, allyl, primary; the chloride ion is left out of the " ..
        "example",
    rxno = "RXNO:0000223",
    target = "[N;X4;+:1]([C;X4:2])([C;X4:3])([C;X4:4])-!@[C;X4;H2:5][c:6]",
    from = "[N;X3;+0:1]([C;X4:2])([C;X4:3])[C;X4:4].[C;X4;H2:5]([c:6])[Cl;X1]",
    conditions = "alkylation",
    also_attacks = { "alkyl halide", "acyl halide", "thiol", "thioether", "primary amine", "secondary amine" },
    recipe = "acetone or MeCN, reflux; also: Br, I",
    yield = { 80, 98 },
    source = "March's Advanced Organic Chemistry; from memory",
    example { "CCCCCCCCCCCC[N+](C)(C)Cc1ccccc1", from = { "CCCCCCCCCCCCN(C)C", "ClCc1ccccc1" } },
    example { "C[N+](C)(C)Cc1ccccc1", from = { "CN(C)C", "ClCc1ccccc1" } },
    refuse { "CC(C)(C)[N+](C)(C)C" }, -- no benzylic CH2 on nitrogen
}

interconversion "delepine" {
    about = "Delepine reaction; primary amine without over-alkylation",
    target = "[C;X4;H2:1]([#6;$(c),$([C;X3]=[C;X3]):3])[N;X3;H2:2]",
    from = "[C;X4;H2:1]([#6:3])[Br;X1].[N;X3;H0:2]12CN3CN(C1)CN(C2)C3",
    conditions = "alkylation",
    also_attacks = { "alkyl halide", "acyl halide", "acetal", "tert-butyl ester", "Boc amine" },
    recipe = "hexamethylenetetramine, CHCl3, reflux, then HCl, EtOH, reflux; also: Cl, I",
    yield = { 65, 88 },
    cautions = { "formaldehyde", "hydrochloric acid" },
    source = "Kürti and Czakó, Strategic Applications of Named Reactions in Organic Synthesis; from memory",
    example { "NCc1ccc(Br)s1", from = { "BrCc1ccc(Br)s1", "C1N2CN3CN1CN(C2)C3" } },
    example { "NCc1ccccc1", from = { "BrCc1ccccc1", "C1N2CN3CN1CN(C2)C3" } },
    refuse { "NCCc1ccccc1" }, -- not allylic or benzylic
}

disconnection "azide-displacement-inversion" {
    about = "Azide displacement of a secondary sulfonate with inversion; inversion",
    target = "[C@;X4;H1:1]([C:4])([C:6])[N;X2;+0:2]=[N;+:3]=[N;-:5]",
    from = "[C@@;X4;H1:1]([C:4])([C:6])[O;X2][S;X4](=O)(=O)[C;H3].[N;-:2]=[N;+:3]=[N;-:5].[Na+]",
    conditions = "alkylation",
    also_attacks = { "alkyl halide", "acyl halide", "epoxide", "terminal alkyne" },
    recipe = "NaN3, DMF, 60-90 °C; also: OTs, Br",
    yield = { 75, 95 },
    cautions = { "sodium azide", "N,N-dimethylformamide" },
    source = "Larock, Comprehensive Organic Transformations; from memory",
    example { "COC(=O)[C@@H]1C[C@H](N=[N+]=[N-])CN1C(=O)OC(C)(C)C", from = { "COC(=O)[C@@H]1C[C@@H](OS(C)(=O)=O)CN1C(=O)OC(C)(C)C", "[N-]=[N+]=[N-].[Na+]" } },
    example { "CCCCCC[C@H](C)N=[N+]=[N-]", from = { "CCCCCC[C@@H](C)OS(C)(=O)=O", "[N-]=[N+]=[N-].[Na+]" } },
    refuse { "CC(C)(C)N=[N+]=[N-]" }, -- tertiary centre: no SN2
}

disconnection "bose-mitsunobu-azide" {
    about = "Bose-Mitsunobu reaction (azide from an alcohol); inversion",
    rxno = "RXNO:0000249",
    target = "[C@;X4;H1:1]([#6:4])([#6:6])[N;X2;+0:2]=[N;+:3]=[N;-:5]",
    from = "[C@@;X4;H1:1]([#6:4])([#6:6])[O;X2;H1].O=P(Oc1ccccc1)(Oc1ccccc1)[N;X2:2]=[N;+:3]=[N;-:5]",
    conditions = "mitsunobu",
    also_attacks = { "free alcohol", "free acid", "phenol", "thiol", "alkyl halide" },
    recipe = "DPPA, PPh3, DIAD, THF, 0 °C; also: DPPA, DBU, toluene (benzylic)",
    yield = { 70, 92 },
    cautions = { "diphenylphosphoryl azide", "diisopropyl azodicarboxylate", "triphenylphosphine" },
    source = "B. Lal, B. N. Pramanik, M. S. Manhas and A. K. Bose, Tetrahedron Lett. 1977, 1977; from memory",
    example { "C[C@H](N=[N+]=[N-])c1ccc2ccccc2c1", from = { "C[C@@H](O)c1ccc2ccccc2c1", "O=P(Oc1ccccc1)(Oc1ccccc1)N=[N+]=[N-]" } },
    example { "C[C@H](N=[N+]=[N-])c1ccccc1", from = { "C[C@@H](O)c1ccccc1", "O=P(Oc1ccccc1)(Oc1ccccc1)N=[N+]=[N-]" } },
    refuse { "CC(C)(C)N=[N+]=[N-]" }, -- tertiary alcohol: no SN2
}

interconversion "amine-n-oxide" {
    about = "Oxidation of a tertiary amine to an N-oxide; nitrogen only",
    target = "[N;X4;+:1]([C;X4:2])([C;X4:3])([C;X4:4])[O;X1;-]",
    from = "[N;X3;+0:1]([C;X4:2])([C;X4:3])[C;X4:4]",
    conditions = "mcpba",
    also_attacks = { "thioether", "thiol", "alkene", "aldehyde", "primary amine", "secondary amine" },
    recipe = "H2O2 (30 %), MeOH, rt; also: mCPBA, CH2Cl2, 0 °C",
    yield = { 80, 97 },
    cautions = { "hydrogen peroxide", "3-chloroperbenzoic acid" },
    source = "Clayden, Greeves, Warren, Organic Chemistry; from memory",
    example { "C[N+]([O-])(C)C1CCC(CC1)c1ccccc1", from = { "CN(C)C1CCC(CC1)c1ccccc1" } },
    example { "C[N+]1([O-])CCOCC1", from = { "CN1CCOCC1" } },
    refuse { "C[N+](C)(C)C" }, -- ammonium ion without oxygen
}

interconversion "pyridine-n-oxide" {
    about = "Oxidation of a pyridine to its N-oxide; less hindered, more basic nitrogen first",
    target = "[n;X3;+;r6:1][O;X1;-]",
    from = "[n;X2;+0;r6:1]",
    conditions = "mcpba",
    also_attacks = { "thioether", "thiol", "alkene", "aldehyde", "primary amine", "secondary amine",
        "tertiary amine" },
    recipe = "mCPBA, CH2Cl2, rt; also: H2O2, AcOH, 70 °C; urea-H2O2, TFAA",
    yield = { 75, 95 },
    cautions = { "3-chloroperbenzoic acid" },
    source = "Carey and Sundberg, Advanced Organic Chemistry, Part B; from memory",
    example { "Cc1cc[n+]([O-])cc1C#N", from = { "Cc1ccncc1C#N" } },
    example { "[O-][n+]1ccccc1", from = { "c1ccncc1" } },
    refuse { "C[n+]1ccccc1" }, -- pyridinium ion without oxygen
}

disconnection "imide-n-alkylation" {
    about = "N-Alkylation of a cyclic imide; N-alkylation; excess of a dihalide for monoalkylation",
    target = "[N;R;$(N(-C=O)-[C,S]=O);!$(N1C(=O)c2ccccc2C1=O):1]-!@[C;X4;H2;$(C[#6;!$([C;X4;H0])]):2]",
    cut = { 2, 1 },
    acceptor = { 2, "alkyl" },
    donor = { 1, "amide-nitrogen" },
    conditions = "alkylation",
    also_attacks = { "alkyl halide", "acyl halide", "primary amine", "phenol", "thiol", "free acid", "epoxide" },
    recipe = "K2CO3, DMF or MeCN, 60-100 °C; also: NaH, saccharin, hydantoin N3, alkyl chloride with KI",
    yield = { 70, 90 },
    cautions = { "N,N-dimethylformamide" },
    source = "Kleemann and Engel, Pharmaceutical Substances; from memory",
    example { "O=C1CC2(CCCC2)CC(=O)N1CCCCBr", from = { "O=C1CC2(CCCC2)CC(=O)N1", "BrCCCCBr" } },
    example { "O=C1CCC(=O)N1Cc1ccccc1", from = { "O=C1CCC(=O)N1", "BrCc1ccccc1" } },
    refuse { "CC(C)(C)N1C(=O)CCC1=O" }, -- tertiary halide eliminates
}

disconnection "pyridone-n-alkylation" {
    about = "N-Alkylation of a pyridone, pyridazinone or quinazolinone; N- over O-alkylation with potassium " ..
        "or lithium salts in polar solvents",
    rxno = "RXNO:0000345",
    target = "[n;r6;X3;+0;$(n(:c=O)):1]-!@[C;X4;H2;$(C[#6;!$([C;X4;H0])]):2]",
    cut = { 2, 1 },
    acceptor = { 2, "alkyl" },
    donor = { 1, "azole" },
    conditions = "alkylation",
    also_attacks = { "alkyl halide", "acyl halide", "primary amine", "phenol", "thiol", "free acid", "epoxide" },
    recipe = "K2CO3 or Cs2CO3, DMF, rt to 60 °C; also: NaH/LiBr, alkyl chloride with KI",
    yield = { 60, 88 },
    cautions = { "N,N-dimethylformamide" },
    source = "Joule and Mills, Heterocyclic Chemistry; from memory",
    example { "CCOC(=O)Cn1cnc2ccc(Br)cc2c1=O", from = { "O=c1[nH]cnc2ccc(Br)cc12", "CCOC(=O)CBr" } },
    example { "O=c1ccccn1Cc1ccccc1", from = { "O=c1cccc[nH]1", "BrCc1ccccc1" } },
    refuse { "CC(C)(C)n1ccccc1=O" }, -- tertiary halide eliminates
}

disconnection "carbamate-n-methylation" {
    about = "N-Methylation of a carbamate; configuration kept with Ag2O or NaH at 0 °C",
    target = "[O;X2:1][C;X3:2](=[O:3])[N;X3;H0:4]([#6;!$([#6]=[O,S,N]):5])-!@[C;X4;H3:6]",
    cut = { 6, 4 },
    acceptor = { 6, "methyl" },
    donor = { 4, "amide-nitrogen" },
    conditions = "base-hindered",
    also_attacks = { "alkyl halide", "acyl halide", "primary amine", "phenol", "thiol", "free acid", "epoxide",
        "free alcohol", "amide" },
    recipe = "NaH, MeI, THF/DMF, 0 °C; also: Ag2O",
    yield = { 75, 95 },
    cautions = { "sodium hydride", "iodomethane", "N,N-dimethylformamide" },
    source = "Wuts, Greene's Protective Groups in Organic Synthesis; from memory",
    example { "COC(=O)[C@H](Cc1ccccc1)N(C)C(=O)OC(C)(C)C", from = { "COC(=O)[C@H](Cc1ccccc1)NC(=O)OC(C)(C)C", "CI" } },
    example { "CN(Cc1ccccc1)C(=O)OC(C)(C)C", from = { "CC(C)(C)OC(=O)NCc1ccccc1", "CI" } },
    refuse { "CN(C)C" }, -- no carbamate
}

disconnection "amide-n-methylation" {
    about = "N-Methylation of an amide or lactam with iodomethane (amide N-alkylation); nitrogen",
    rxno = "RXNO:0000340",
    target = "[#6:1][C;X3:2](=[O;X1:3])[N;X3;H0:4]([#6;!$([#6]=[O,S,N]):5])-!@[C;X4;H3:6]",
    cut = { 6, 4 },
    acceptor = { 6, "methyl" },
    donor = { 4, "amide-nitrogen" },
    conditions = "base-hindered",
    also_attacks = { "alkyl halide", "acyl halide", "primary amine", "phenol", "thiol", "free acid", "epoxide",
        "free alcohol" },
    recipe = "NaH or KOtBu, MeI, DMF or THF, 0 °C to rt; also: Me2SO4",
    yield = { 75, 95 },
    cautions = { "sodium hydride", "iodomethane", "N,N-dimethylformamide", "potassium tert-butoxide" },
    source = "Kleemann and Engel, Pharmaceutical Substances; from memory",
    example { "CN1C(=O)CN=C(c2ccccc2)c2cc(Cl)ccc12", from = { "O=C1CN=C(c2ccccc2)c2cc(Cl)ccc2N1", "CI" } },
    example { "CN(C(C)=O)c1ccccc1", from = { "CC(=O)Nc1ccccc1", "CI" } },
    refuse { "CNC(C)=O" }, -- N-H left: no alkylation of the nitrogen shown
}

disconnection "azole-n-methylation" {
    about = "N-Methylation of an azole or indole with iodomethane (heteroaryl N-alkylation); less hindered " ..
        "nitrogen of unsymmetrical azoles; mixtures are common",
    rxno = "RXNO:0000345",
    target = "[n;X3;+0;r5:1]-!@[C;X4;H3:2]",
    cut = { 2, 1 },
    acceptor = { 2, "methyl" },
    donor = { 1, "azole" },
    conditions = "alkylation",
    also_attacks = { "alkyl halide", "acyl halide", "primary amine", "phenol", "thiol", "free acid", "epoxide" },
    recipe = "NaH or K2CO3, MeI, DMF, 0 °C to rt; also: Me2SO4, dimethyl carbonate",
    yield = { 75, 95 },
    cautions = { "sodium hydride", "iodomethane", "N,N-dimethylformamide" },
    source = "Joule and Mills, Heterocyclic Chemistry; from memory",
    example { "Cn1cc(C=O)c2cc(Br)ccc12", from = { "O=Cc1c[nH]c2ccc(Br)cc12", "CI" } },
    example { "Cn1ccc2ccccc21", from = { "c1ccc2[nH]ccc2c1", "CI" } },
    refuse { "C[n+]1ccccc1" }, -- a pyridinium
}

disconnection "enamino-ester" {
    about = "Enamino ester from a β-keto ester and an amine; ketone before ester; Z with an N-H bridge",
    target = "[N;X3;!$(N-[N,O]):1]-!@[C;X3;H0:2]([#6:8])=[C;X3;H1:3][C;X3:4](=[O:5])[O;X2:6]",
    from = "[N:1].O=[C:2]([#6:8])[C;H2:3][C:4](=[O:5])[O:6]",
    conditions = "amine-heat",
    also_attacks = { "other ketone", "aldehyde", "acyl halide", "primary amine" },
    recipe = "AcOH (cat.), EtOH or toluene, reflux; also: NH3/MeOH, NH4OAc",
    yield = { 75, 95 },
    source = "Joule and Mills, Heterocyclic Chemistry; from memory",
    example { "COC(=O)C=C(C)Nc1ccc(Cl)cc1", from = { "Nc1ccc(Cl)cc1", "COC(=O)CC(C)=O" } },
    example { "CCOC(=O)C=C(C)Nc1ccccc1", from = { "Nc1ccccc1", "CCOC(=O)CC(C)=O" } },
    refuse { "CN(C)C=CC(=O)OC" }, -- no substituent: from DMF dimethyl acetal or a propiolate
}

disconnection "enaminone-from-diketone" {
    about = "Enaminone from a 1,3-diketone and an amine; two isomers from an unsymmetrical dione",
    target = "[N;X3;!$(N-[N,O]):1]-!@[C;X3;H0:2]([#6:8])=[C;X3;H1:3][C;X3:4](=[O:5])[#6:6]",
    from = "[N:1].O=[C:2]([#6:8])[C;H2:3][C:4](=[O:5])[#6:6]",
    conditions = "amine-heat",
    also_attacks = { "other ketone", "aldehyde", "acyl halide", "primary amine" },
    recipe = "AcOH or TsOH (cat.), toluene, reflux; also: NH4OAc for the primary enaminone",
    yield = { 75, 95 },
    source = "Joule and Mills, Heterocyclic Chemistry; from memory",
    example { "O=C1CC(C)(C)CC(Nc2ccc(cc2)C#N)=C1", from = { "Nc1ccc(cc1)C#N", "O=C1CC(=O)CC(C)(C)C1" } },
    example { "CC(=O)C=C(C)Nc1ccccc1", from = { "Nc1ccccc1", "CC(=O)CC(C)=O" } },
    refuse { "CN(C)C=CC(C)=O" }, -- no substituent: from DMF dimethyl acetal
}

disconnection "epoxide-opening-by-azole" {
    about = "Opening of an epoxide by an azole; less hindered carbon; N1 of 1,2,4-triazole",
    target = "[n;r5;X3:1]-!@[C;X4;H2:2][C;X4:3][O;H1:4]",
    cut = { 2, 1 },
    acceptor = { 2, "oxirane" },
    donor = { 1, "azole" },
    conditions = "alkylation",
    also_attacks = { "alkyl halide", "acyl halide", "enone", "other epoxide", "activated ester" },
    recipe = "K2CO3, DMF, 80-90 °C; also: DBU, LiClO4",
    yield = { 60, 85 },
    cautions = { "N,N-dimethylformamide" },
    source = "Kleemann and Engel, Pharmaceutical Substances; from memory",
    example { "OC(Cn1cncn1)(Cn1cncn1)c1ccc(F)cc1F", from = { "c1nc[nH]n1", "Fc1cc(F)c(cc1)C1(Cn2cncn2)CO1" } },
    example { "CC(O)Cn1ccnc1", from = { "c1c[nH]cn1", "CC1CO1" } },
    refuse { "c1nn(CCCO)cn1" }, -- the hydroxyl group is not on the next carbon
}

disconnection "ethoxymethylene-amine" {
    about = "Addition-elimination of an amine at an ethoxymethylene compound; Z/E set by the N-H bridge",
    target = "[N;X3:1]-!@[C;X3;H1:2]=[C;X3:3]([C;$(C(=O)[O,C]),$(C#N):4])[C;$(C(=O)[O,C]),$(C#N):5]",
    from = "[N:1].CCO[C:2]=[C:3]([C:4])[C:5]",
    conditions = "amine-heat",
    also_attacks = { "other primary amine", "hydrazine", "thiol", "acyl halide" },
    recipe = "EtOH or neat, 80-120 °C; also: methoxymethylene, dimethylaminomethylene",
    yield = { 80, 97 },
    source = "Joule and Mills, Heterocyclic Chemistry; from memory",
    example { "CCOC(=O)C(=CNc1ccc(F)c(Cl)c1)C(=O)OCC", from = { "Nc1ccc(F)c(Cl)c1", "CCOC=C(C(=O)OCC)C(=O)OCC" } },
    example { "CCOC(=O)C(=CNc1ccccc1)C(=O)OCC", from = { "Nc1ccccc1", "CCOC=C(C(=O)OCC)C(=O)OCC" } },
    refuse { "CNC=CC(C)=O" }, -- only one acceptor group
}

disconnection "nitroketene-aminal" {
    about = "Addition-elimination of an amine at a methylthio nitroalkene",
    target = "[N;X3:1]-!@[C;X3:2]([N:5])=[C;X3;H1:3][N+:4](=[O:6])[O-:7]",
    from = "[N:1].[C;H3]S[C:2]([N:5])=[C:3][N+:4](=[O:6])[O-:7]",
    conditions = "amine-heat",
    also_attacks = { "other primary amine", "thiol", "acyl halide" },
    recipe = "H2O or EtOH, 25-80 °C; methanethiol leaves",
    yield = { 70, 90 },
    cautions = { "methanethiol" },
    source = "Kleemann and Engel, Pharmaceutical Substances; from memory",
    example { "CNC(NCCSCc1ccc(CN(C)C)o1)=C[N+](=O)[O-]", from = { "CN(C)Cc1ccc(CSCCN)o1", "CNC(SC)=C[N+](=O)[O-]" } },
    example { "CNC(NCc1ccccc1)=C[N+](=O)[O-]", from = { "NCc1ccccc1", "CNC(SC)=C[N+](=O)[O-]" } },
    refuse { "CN(C)C=C[N+](=O)[O-]" }, -- only one nitrogen on the carbon
}

disconnection "cyanoguanidine-from-isothiourea" {
    about = "Cyanoguanidine from an N-cyano-S-methylisothiourea and an amine",
    target = "[N;X3:1]-!@[C;X3:2]([N;X3:3])=[N;X2:4][C;X2:5]#[N:6]",
    from = "[N:1].[C;H3]S[C:2]([N:3])=[N:4][C:5]#[N:6]",
    conditions = "amine-heat",
    also_attacks = { "other primary amine", "thiol", "acyl halide" },
    recipe = "EtOH or MeCN, reflux; methanethiol leaves",
    yield = { 65, 88 },
    cautions = { "methanethiol" },
    source = "Kleemann and Engel, Pharmaceutical Substances; from memory",
    example { "CNC(NCCSCc1nc[nH]c1C)=NC#N", from = { "Cc1[nH]cnc1CSCCN", "CNC(SC)=NC#N" } },
    example { "CNC(NCc1ccccc1)=NC#N", from = { "NCc1ccccc1", "CNC(SC)=NC#N" } },
    refuse { "CNC(N)=N" }, -- no cyano group
}

disconnection "aryl-guanidine-cyanamide" {
    about = "Arylguanidine from an aniline and cyanamide",
    target = "[c:1][N;X3;H1:2][C;X3:3](=[N;X2;H1:4])[N;X3;H2:5]",
    from = "[c:1][N;H2:2].[N;H2:5][C:3]#[N;H0:4]",
    conditions = "acid-hot-dry",
    also_attacks = { "other primary amine", "thiol", "acyl halide", "acetal" },
    recipe = "50% aq. NH2CN, HNO3 or HCl, EtOH, reflux; isolated as nitrate or carbonate",
    yield = { 55, 85 },
    cautions = { "cyanamide", "hydrochloric acid", "nitric acid" },
    source = "Kleemann and Engel, Pharmaceutical Substances; from memory",
    example { "Cc1ccc(cc1NC(=N)N)[N+](=O)[O-]", from = { "Cc1ccc(cc1N)[N+](=O)[O-]", "NC#N" } },
    example { "N=C(N)Nc1ccccc1", from = { "Nc1ccccc1", "NC#N" } },
    refuse { "CNC(N)=O" }, -- a urea
}

interconversion "chloroformate-demethylation" {
    about = "Carbamate from an N-methylamine and ethyl chloroformate; methyl leaves before ring carbons; " ..
        "benzyl and allyl leave before methyl",
    target = "[C;X4;!$(C-c);!$(C-C=C):2][N;X3;R:1]([C;X4;!$(C-c);!$(C-C=C):3])[C;X3:4](=[O:5])[O:6][C;H2:7][C;H3:8]",
    from = "[C:2][N:1]([C:3])[C;H3].Cl[C:4](=[O:5])[O:6][C:7][C:8]",
    conditions = "acylation",
    also_attacks = { "primary amine", "secondary amine", "free alcohol", "phenol", "thiol",
        "other tertiary amine" },
    recipe = "ClCO2Et, Et3N or K2CO3, toluene, 80-110 °C; also: phenyl, vinyl, 1-chloroethyl chloroformate",
    yield = { 70, 90 },
    cautions = { "ethyl chloroformate", "triethylamine" },
    source = "Kleemann and Engel, Pharmaceutical Substances; from memory",
    example { "CCOC(=O)N1CCC(CC1)=C1c2ccc(Cl)cc2CCc2cccnc12", from = { "CN1CCC(CC1)=C1c2ccc(Cl)cc2CCc2cccnc12", "CCOC(=O)Cl" } },
    example { "CCOC(=O)N1CCC(CC1)c1ccccc1", from = { "CN1CCC(CC1)c1ccccc1", "CCOC(=O)Cl" } },
    refuse { "CCOC(=O)NC" }, -- a secondary carbamate
}

interconversion "n-demethylation-one-pot" {
    about = "N-Demethylation with 1-chloroethyl chloroformate; methyl leaves before ring carbons",
    target = "[C;X4;R;!$(C-c);!$(C-C=C):2][N;X3;H1;+0;R:1][C;X4;R;!$(C-c);!$(C-C=C):3]",
    from = "[C:2][N;H0:1]([C:3])[C;H3]",
    conditions = "acylation",
    also_attacks = { "amidine", "primary amine", "secondary amine", "free alcohol", "phenol", "thiol",
        "other tertiary amine", "acetal" },
    recipe = "ClCO2CHClCH3, 1,2-dichloroethane, reflux, then MeOH reflux",
    yield = { 65, 90 },
    cautions = { "1-chloroethyl chloroformate" },
    source = "Larock, Comprehensive Organic Transformations; from memory",
    example { "COC(=O)C1CC2CCC(N2)C1c1ccc(Cl)cc1", from = { "COC(=O)C1CC2CCC(N2C)C1c1ccc(Cl)cc1" } },
    example { "C1CC(CCN1)c1ccccc1", from = { "CN1CCC(CC1)c1ccccc1" } },
    refuse { "CN(C)C" }, -- no N-H
    refuse { "CCNCC" }, -- kept to ring amines
}

interconversion "n-methyl-from-carbamate" {
    about = "N-Methylamine by reduction of a carbamate; monomethylation without excess",
    target = "[C;X4:2][N;X3;+0;!$(N([CH3])[CH3]);!$(N-[C,S]=[O,S,N]);!$(N-[#7,#8]):1][C;X4;H3:3]",
    from = "[C:2][N:1][C;H0:3](=O)OC(C)(C)C",
    conditions = "lialh4",
    also_attacks = { "ester", "amide", "nitrile", "ketone", "aldehyde", "free acid", "nitro", "alkyl halide",
        "epoxide", "aryl bromide" },
    recipe = "LiAlH4, THF, reflux; also: ethyl, methyl or benzyl carbamate",
    yield = { 75, 93 },
    cautions = { "lithium aluminium hydride" },
    source = "Larock, Comprehensive Organic Transformations; from memory",
    example { "CN[C@@H](C)Cc1ccc(F)cc1", from = { "C[C@@H](Cc1ccc(F)cc1)NC(=O)OC(C)(C)C" } },
    example { "CN1CCC(CC1)c1ccccc1", from = { "CC(C)(C)OC(=O)N1CCC(CC1)c1ccccc1" } },
    refuse { "CC(C)(C)N" }, -- no methyl on nitrogen
}

disconnection "azide-from-primary-sulfonate" {
    about = "Azide displacement of a primary mesylate; no rearrangement",
    target = "[C;X4;H2;$(C[#6;!$([C;X4;H0])]):1]-[N;X2;+0:2]=[N;X2;+1:3]=[N;X1;-1:4]",
    from = "[C:1]OS(C)(=O)=O.[N;-1:2]=[N;+1:3]=[N;-1:4].[Na+]",
    conditions = "alkylation",
    also_attacks = { "alkyl halide", "other sulfonate", "acyl halide", "epoxide", "terminal alkyne", "nitrile" },
    recipe = "NaN3, DMF or DMSO, 60-80 °C; also: tosylate",
    yield = { 80, 95 },
    cautions = { "sodium azide", "N,N-dimethylformamide", "dimethyl sulfoxide" },
    source = "Carey and Sundberg, Advanced Organic Chemistry, Part B; from memory",
    example { "CC(C)(C)OC(=O)N1CCC(CN=[N+]=[N-])CC1", from = { "CC(C)(C)OC(=O)N1CCC(COS(C)(=O)=O)CC1", "[N-]=[N+]=[N-].[Na+]" } },
    example { "[N-]=[N+]=NCCCc1ccccc1", from = { "CS(=O)(=O)OCCCc1ccccc1", "[N-]=[N+]=[N-].[Na+]" } },
    refuse { "CC(C)N=[N+]=[N-]" }, -- secondary: inversion row
}

disconnection "primary-amine-monoalkylation" {
    about = "Monoalkylation of a primary amine by an activated halide; excess of amine or slow addition of " ..
        "the halide against dialkylation",
    target = "[C;X4:1][N;X3;H1;+0;!$(N-[C,S]=[O,S,N]):2]-!@[C;X4;H2;$(C-c),$(C-C=C),$(C-[CX3]=O):3]",
    cut = { 3, 2 },
    acceptor = { 3, "alkyl" },
    donor = { 2, "amine" },
    conditions = "alkylation",
    also_attacks = { "alkyl halide", "acyl halide", "primary amine", "phenol", "thiol", "free acid", "epoxide",
        "other primary amine", "secondary amine" },
    recipe = "amine (2-5 equiv.), K2CO3 or iPr2NEt, MeCN or THF, 0 °C to rt; also: alkyl chloride, tosylate",
    yield = { 55, 80 },
    source = "Clayden, Greeves, Warren, Organic Chemistry; from memory",
    example { "CCOC(=O)CNC1CCN(C(=O)OC(C)(C)C)CC1", from = { "NC1CCN(C(=O)OC(C)(C)C)CC1", "CCOC(=O)CBr" } },
    example { "CC(C)NCc1ccccc1", from = { "CC(C)N", "BrCc1ccccc1" } },
    refuse { "CN(C)Cc1ccccc1" }, -- no N-H: alkylated twice
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
    example { "CC(C)NCc1ccccc1", from = { "O=Cc1ccccc1", "CC(C)N" } },
    refuse { "CC(C)(C)NC(C)(C)C" }, -- no CH2 on nitrogen
}

disconnection "reductive-amination-ketone" {
    about = "Reductive amination of a ketone with an amine; equatorial or axial mixture in rings; slower than aldehydes",
    rxno = "RXNO:0000335",
    target = "[#6;!$(C=[O,N]);!$(C#N):4][C;X4;H1:1]([C;X4:6])-!@[N;X3;!$(N[C,S]=[O,S,N]);!$(N[#7,#8,#15,#16]);!$(N-c:[nX2]);!H2:2]",
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
    example { "C1CCC(CC1)N1CCOCC1", from = { "O=C1CCCCC1", "C1COCCN1" } },
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
    example { "C1CCN(C1)Cc1ccccc1", from = { "O=Cc1ccccc1", "C1CCCN1" } },
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
    example { "CN1CCCCC1", from = { "C1CCNCC1", "C=O" } },
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
    example { "CC(NCc1ccccc1)c1ccccc1", from = { "CC(=NCc1ccccc1)c1ccccc1" } },
    refuse { "CC(C)(C)NC" }, -- carbon on one side carries no H, the other is a methyl group
}

disconnection "amine-alkylation" {
    about = "Alkylation of a secondary amine by an alkyl halide; over-alkylation to the quaternary salt is the rival; primary amines give mixtures",
    also = { "amine-alkylation-mesylate" },
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
    example { "C1CCN(CC1)Cc1ccccc1", from = { "C1CCNCC1", "BrCc1ccccc1" } },
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
    example { "O=C1c2ccccc2C(=O)N1Cc1ccccc1", from = { "O=C1NC(=O)c2ccccc12", "BrCc1ccccc1" } },
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
    example { "NCc1ccccc1", from = { "O=C1c2ccccc2C(=O)N1Cc1ccccc1" } },
    refuse { "CNCc1ccccc1" }, -- secondary amine is not formed
}

interconversion "azide-reduction" {
    about = "Staudinger reduction of an azide; configuration kept",
    target = "[CX4:1][N;X3;H2:2]",
    from = "[#6:1][N;X2;H0:2]=[N+]=[N-]",
    conditions = "phosphine",
    also_attacks = { "azide", "aldehyde", "acyl halide" },
    recipe = "PPh3, THF-H2O, rt to 50 °C; also: H2, Pd/C; Zn, NH4Cl",
    yield = { 80, 97 },
    cautions = { "organic azides", "triphenylphosphine" },
    source = "March's Advanced Organic Chemistry; from memory",
    example { "COC(=O)[C@@H]1C[C@H](N)CN1C(=O)OC(C)(C)C", from = { "COC(=O)[C@@H]1C[C@H](N=[N+]=[N-])CN1C(=O)OC(C)(C)C" } },
    example { "NCc1ccccc1", from = { "[N-]=[N+]=NCc1ccccc1" } },
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
    example { "NCCc1ccccc1", from = { "N#CCc1ccccc1" } },
    refuse { "CC(N)c1ccccc1" }, -- amine on a CH needs an organometallic as well
}

interconversion "nitro-reduction" {
    about = "Nitro reduction to amine; ester and aryl chloride survive with Fe, Zn or SnCl2",
    rxno = "RXNO:0000337",
    target = "[c;!$(c(:n):n):1][N;X3;H2;+0:2]",
    from = "[c:1][N;X3;H0;+:2](=[O;X1])[O;X1;-]",
    conditions = "fe-acid",
    also_attacks = { "nitro", "azide", "imine", "aldehyde" },
    recipe = "Fe, NH4Cl, EtOH-H2O, 70 °C; also: H2, Pd/C (no halide, alkene, benzyl group); SnCl2; Na2S2O4",
    yield = { 80, 97 },
    cautions = { "iron powder" },
    source = "Clayden, Greeves, Warren, Organic Chemistry; from memory",
    example { "COC(=O)c1ccc(N)c(Cl)c1", from = { "COC(=O)c1ccc([N+](=O)[O-])c(Cl)c1" } },
    example { "CCOC(=O)c1ccc(N)cc1", from = { "CCOC(=O)c1ccc([N+](=O)[O-])cc1" } },
    refuse { "NCc1ccccc1" }, -- amine not on the arene
}

interconversion "amide-reduction" {
    about = "Amide reduction to amine; C=O becomes CH2 (whole alkyl group on N)",
    rxno = "RXNO:0000338",
    target = "[#6;!$(C=[O,N]):1][C;X4;H2:2]-[N;X3;!$(N[C,S]=[O,S,N]);!$(N[#7,#8,#15,#16]);!$(N-c:[nX2]):3]",
    from = "[#6:1][C;X3;H0:2](=[O;X1])[N;X3:3]",
    when = function(m) return m.molecule:count "[OX2H1]" <= 3 and not m.molecule:has "[NX3][N+](=O)[O-]" end, -- LiAlH4 makes a lump of a polyol
    conditions = "lialh4",
    also_attacks = { "oxime", "aldehyde", "ketone", "ester", "free acid", "amide", "nitrile", "epoxide", "acyl halide",
        "alkyl halide", "nitro", "azide" },
    recipe = "LiAlH4, THF, reflux; also: BH3·THF (spares ester, nitro)",
    yield = { 75, 95 },
    cautions = { "lithium aluminium hydride" },
    source = "Clayden, Greeves, Warren, Organic Chemistry; from memory",
    example { "CCN1CCCc2cc(OC)ccc12", from = { "CC(=O)N1CCCc2cc(OC)ccc12" } },
    example { "CCNc1ccccc1", from = { "CC(=O)Nc1ccccc1" } },
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
    example { "NC1CCCCC1", from = { "ON=C1CCCCC1" } },
    refuse { "CC(C)(C)N" }, -- no H on the amine carbon
}

disconnection "azole-n-alkylation" {
    about = "Heteroaryl N-alkylation; less hindered N; regioisomers in unsymmetrical pyrazoles, imidazoles, triazoles, indazoles",
    rxno = "RXNO:0000345",
    target = "[n;X3;+0;r5:1]-!@[C;X4;$([C;H2][#6;!$([C;X4;H0])]):2]",
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
    example { "c1ccc(Cn2ccnc2)cc1", from = { "c1c[nH]cn1", "BrCc1ccccc1" } },
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
    example { "Cc1ccc(cc1)S(=O)(=O)N(Cc1ccccc1)c1ccccc1", from = { "Cc1ccc(cc1)S(=O)(=O)Nc1ccccc1", "BrCc1ccccc1" } },
    refuse { "CS(=O)(=O)NC(C)(C)C" }, -- N-H left and a tertiary alkyl group
}

disconnection "amide-n-alkylation" {
    about = "Amide N-alkylation; N before O in polar aprotic solvent",
    rxno = "RXNO:0000340",
    target = "[#6:1][C;X3:2](=[O;X1:3])[N;X3;H0:4]([#6:5])-!@[C;X4;$([C;H2][#6;!$([C;X4;H0])]):6]",
    cut = { 6, 4 },
    acceptor = { 6, "alkyl" },
    donor = { 4, "amide-nitrogen" },
    when = function(m) return not m.molecule:has "[CX4;!H0]([$([CX3]=[OX1]),$(C#N),$([N+]=O)])[$([CX3]=[OX1]),$(C#N),$([N+]=O)]" end,
    conditions = "alkylation",
    also_attacks = { "other secondary amide", "other primary amide", "carbamate N-H", "other urea", "alkyl halide", "acyl halide", "ester", "ketone", "free alcohol", "phenol", "thiol",
        "free acid", "epoxide" },
    recipe = "NaH, DMF or THF, 0 °C to rt; also: I, Cl, OTs",
    yield = { 70, 92 },
    cautions = { "sodium hydride", "N,N-dimethylformamide" },
    source = "Larock, Comprehensive Organic Transformations; from memory",
    example { "O=C1CCCCN1Cc1ccc(Cl)cc1", from = { "O=C1CCCCN1", "BrCc1ccc(Cl)cc1" } },
    example { "O=C1CCCN1Cc1ccccc1", from = { "O=C1CCCN1", "BrCc1ccccc1" } },
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
    example { "C(Nc1ccccc1)c1ccccc1", from = { "Nc1ccccc1", "BrCc1ccccc1" } },
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
    example { "O=C(CN1CCCCC1)Nc1ccccc1", from = { "C1CCNCC1", "O=C(CCl)Nc1ccccc1" } },
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
    example { "[N-]=[N+]=NCc1ccccc1", from = { "BrCc1ccccc1", "[N-]=[N+]=[N-].[Na+]" } },
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
    example { "NNCc1ccccc1", from = { "BrCc1ccccc1", "NN" } },
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
    example { "N=C(N)NCc1ccccc1", from = { "NCc1ccccc1", "N=C(N)n1cccn1" } },
    refuse { "CC(N)=N" }, -- amidine: the carbon bears carbon
}
