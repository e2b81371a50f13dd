-- Hydrolyses.
-- Yields are typical ranges and sources stand from memory unless a source says otherwise.

pack {
    name = "hydrolysis",
    version = "0.1.0",
    licence = "CC0-1.0",
    about = "Hydrolyses",
    needs = { "synthons" },
}

interconversion "anilide-hydrolysis" {
    about = "Hydrolysis of an acetanilide to the aniline; no isomers to expect",
    target = "[c:1][N;X3;H2;+0:2]",
    from = "[c:1][N:2]C(C)=O",
    conditions = "acid-aq-strong",
    also_attacks = { "acetal", "Boc carbamate", "tert-butyl ester", "silyl ether", "ester", "nitrile" },
    recipe = "HCl, EtOH/H2O, reflux, then base; also: NaOH, EtOH, reflux; N-formyl, N-propionyl, N-pivaloyl",
    yield = { 80, 95 },
    cautions = { "hydrochloric acid" },
    source = "Vogel's Textbook of Practical Organic Chemistry; from memory",
    example { "Nc1ccc(cc1Br)[N+](=O)[O-]", from = { "CC(=O)Nc1ccc(cc1Br)[N+](=O)[O-]" } },
    refuse { "NCc1ccccc1" }, -- a benzylic amine, not an aniline
}

interconversion "amine-from-acetamide" {
    about = "Hydrolysis of an N-alkylacetamide to the amine; completes a Ritter reaction",
    target = "[C;X4:1][N;X3;H1,H2;+0;!$(N-[C,S]=[O,S,N]);!$(N-[N,O]);!$(N-c):2]",
    from = "[C:1][N:2]C(C)=O",
    conditions = "acid-aq-strong",
    also_attacks = { "acetal", "Boc carbamate", "tert-butyl ester", "silyl ether", "ester", "nitrile",
        "other amide" },
    recipe = "20% HCl or KOH in ethylene glycol, reflux; also: formamide, benzamide, chloroacetamide (thiourea)",
    yield = { 70, 90 },
    cautions = { "potassium hydroxide", "hydrochloric acid" },
    source = "March's Advanced Organic Chemistry; from memory",
    example { "CC(C)(N)Cc1ccc(Cl)cc1", from = { "CC(=O)NC(C)(C)Cc1ccc(Cl)cc1" } },
    refuse { "CN(C)C" }, -- a tertiary amine has no N-H to free
}

interconversion "carbamate-hydrolysis" {
    about = "Cleavage of an ethyl carbamate to the amine; completes the N-demethylation with a chloroformate",
    rxno = "RXNO:0000320",
    target = "[C;X4:2][N;X3;H1;+0;!$(N-[C,S]=[O,S,N]);!$(N-[N,O]);!$(N-c):1][C;X4:3]",
    from = "[C:2][N;H0:1]([C:3])C(=O)OCC",
    conditions = "base-aq-strong",
    also_attacks = { "ester", "amide", "nitrile", "acyl halide", "epoxide", "alkyl halide" },
    recipe = "KOH, EtOH/H2O, reflux; also: methyl carbamate, 48% HBr, TMSI",
    yield = { 75, 92 },
    cautions = { "potassium hydroxide" },
    source = "Kleemann and Engel, Pharmaceutical Substances; from memory",
    example { "Clc1ccc2c(c1)CCc1cccnc1C2=C1CCNCC1", from = { "CCOC(=O)N1CCC(CC1)=C1c2ccc(Cl)cc2CCc2cccnc12" } },
    refuse { "CNC(C)=O" }, -- an amide nitrogen
}

interconversion "benzal-halide-hydrolysis" {
    about = "Aldehyde from a benzal bromide; no isomers to expect",
    target = "[c:1][C;X3;H1:2]=[O;X1]",
    from = "[c:1][C;H1:2](Br)Br",
    conditions = "acid-aq-strong",
    also_attacks = { "alkyl halide", "acyl halide", "acetal" },
    recipe = "AgNO3, aq. EtOH; also: CaCO3/H2O reflux, HCO2H reflux, morpholine then acid; benzal chloride",
    yield = { 65, 88 },
    cautions = { "silver nitrate" },
    source = "Vogel's Textbook of Practical Organic Chemistry; from memory",
    example { "O=Cc1ccc(C#N)cc1F", from = { "N#Cc1ccc(C(Br)Br)c(F)c1" } },
    refuse { "O=CCc1ccccc1" }, -- carbonyl carbon is not on the ring
}

interconversion "gem-diacetate-hydrolysis" {
    about = "Aldehyde from an aryl gem-diacetate; no isomers to expect",
    target = "[c:1][C;X3;H1:2]=[O;X1]",
    from = "[c:1][C;H1:2](OC(C)=O)OC(C)=O",
    conditions = "acid-aq-mild",
    also_attacks = { "acetal", "ester", "Boc carbamate" },
    recipe = "H2SO4, EtOH/H2O, reflux 30 min; also: HCl",
    yield = { 80, 95 },
    cautions = { "sulfuric acid" },
    source = "Vogel's Textbook of Practical Organic Chemistry; from memory",
    example { "O=Cc1ccc(cc1Cl)[N+](=O)[O-]", from = { "CC(=O)OC(OC(C)=O)c1ccc(cc1Cl)[N+](=O)[O-]" } },
    refuse { "O=CC1CCCCC1" }, -- aliphatic
}

interconversion "acid-from-primary-amide" {
    about = "Hydrolysis of a primary amide to the acid; nitrous acid cleaves even hindered amides",
    target = "[#6;!$([CX4]-C(=O)[OX2H1]):1][C;X3:2](=[O;X1:3])[O;X2;H1]",
    from = "[#6:1][C;X3:2](=[O;X1:3])[N;H2]",
    conditions = "acid-aq-strong",
    also_attacks = { "primary amine", "acetal", "Boc carbamate", "tert-butyl ester", "silyl ether", "ester",
        "nitrile" },
    recipe = "NaNO2, H2SO4, 0-80 °C; also: 6 M HCl reflux, 20% KOH reflux",
    yield = { 70, 90 },
    cautions = { "sulfuric acid", "sodium nitrite" },
    source = "Vogel's Textbook of Practical Organic Chemistry; from memory",
    example { "OC(=O)c1c(Cl)cccc1C(F)(F)F", from = { "NC(=O)c1c(Cl)cccc1C(F)(F)F" } },
    refuse { "NC(=O)O" }, -- carbamic acid is not stable
}

interconversion "malonate-hydrolysis-decarboxylation" {
    about = "Carboxylic acid from a substituted malonic ester in one pot; no isomers to expect",
    rxno = "RXNO:0000107",
    target = "[#6;!$(C-[OX2H]):3][C;X4;H2:1][C;X3:2](=[O;X1:4])[O;X2;H1]",
    from = "[#6:3][C;H1:1](C(=O)OCC)[C:2](=[O:4])OCC",
    conditions = "acid-aq-strong",
    also_attacks = { "acetal", "Boc carbamate", "tert-butyl ester", "silyl ether", "ester", "nitrile",
        "amide" },
    recipe = "6 M HCl, AcOH, reflux; also: KOH then H2SO4 reflux; dimethyl malonate",
    yield = { 70, 90 },
    cautions = { "hydrochloric acid" },
    source = "Vogel's Textbook of Practical Organic Chemistry; from memory",
    example { "OC(=O)CCCc1ccc(F)cc1", from = { "CCOC(=O)C(CCc1ccc(F)cc1)C(=O)OCC" } },
    refuse { "OC(=O)C(C)(C)C" }, -- quaternary alpha carbon
}

interconversion "thioamide-hydrolysis" {
    about = "Hydrolysis of an arylthioacetomorpholide (end of the Willgerodt-Kindler reaction); no isomers to expect",
    target = "[c:1][C;X4;H2:2][C;X3:3](=[O;X1])[O;X2;H1]",
    from = "[c:1][C:2][C:3](=S)N1CCOCC1",
    conditions = "base-aq-strong",
    also_attacks = { "ester", "nitrile", "amide", "alkyl halide" },
    recipe = "KOH, EtOH/H2O, reflux; also: AcOH/H2SO4, reflux",
    yield = { 70, 90 },
    cautions = { "hydrogen sulfide", "potassium hydroxide" },
    source = "Vogel's Textbook of Practical Organic Chemistry; from memory",
    example { "COc1ccc2cc(CC(=O)O)ccc2c1", from = { "COc1ccc2cc(CC(=S)N3CCOCC3)ccc2c1" } },
    refuse { "OC(=O)CCc1ccccc1" }, -- the chain must end in the second carbon
}

interconversion "cyclic-enol-ether-hydrolysis" {
    about = "Hydrolysis of 3,4-dihydro-2H-pyran to the hydroxy aldehyde; in equilibrium with the cyclic hemiacetal",
    target = "[O;X2;H1:1][C;X4:2][C;X4:3][C;X4:4][C;X4;H2:5][C;X3;H1:6]=[O;X1]",
    from = "[O;H0:1]1[C:2][C:3][C:4][C;H1:5]=[C;H1:6]1",
    conditions = "acid-aq-mild",
    also_attacks = { "acetal", "silyl ether" },
    recipe = "dil. HCl, H2O, rt",
    yield = { 75, 95 },
    cautions = { "hydrochloric acid" },
    source = "Vogel's Textbook of Practical Organic Chemistry; from memory",
    example { "O=CCCCC(O)c1ccccc1", from = { "C1=COC(CC1)c1ccccc1" } },
    refuse { "O=CCCCO" }, -- four carbons: comes from a dihydrofuran
}

interconversion "benzal-chloride-hydrolysis" {
    about = "Aromatic aldehyde by hydrolysis of a benzal chloride",
    target = "[c:1][CX3;H1:2]=[OX1]",
    from = "[c:1][CX4;H1:2]([ClX1])[ClX1]",
    conditions = "acid-aq-strong",
    also_attacks = { "ester", "acetal", "benzylic halide" },
    recipe = "water, cat. FeCl3 or ZnCl2, 100 °C (or CaCO3, water, reflux)",
    yield = { 70, 90 },
    source = "common practice, no source",
    example { "O=Cc1ccccc1", from = { "ClC(Cl)c1ccccc1" } },
    refuse { "O=CCc1ccccc1" }, -- the carbonyl carbon is not on the ring
}

interconversion "malonic-ester-saponification" {
    about = "Both ester groups of a diethyl malonate to the diacid",
    target = "[OX2H:1][CX3:2](=[OX1:3])[CX4:4][CX3:5](=[OX1:6])[OX2H:7]",
    from = "[CH3][CH2][O:1][C:2](=[O:3])[C:4][C:5](=[O:6])[O:7][CH2][CH3]",
    conditions = "base-aq-strong",
    also_attacks = { "other ester", "acyl halide", "anhydride", "alkyl halide" },
    recipe = "KOH (excess), aqueous EtOH, reflux; acid at 0 °C",
    yield = { 80, 95 },
    cautions = { "potassium hydroxide" },
    source = "Vogel's Textbook of Practical Organic Chemistry; from memory",
    example { "CCCC(CCC)(C(=O)O)C(=O)O", from = { "CCCC(CCC)(C(=O)OCC)C(=O)OCC" } },
    refuse { "O=C(O)CCC(=O)O" }, -- a succinic acid
}

interconversion "nitrobenzoate-removal" {
    about = "Alcohol from its 4-nitrobenzoate by mild base; the configuration stays",
    target = "[CX4;H1;R;!$(C([#8])[#7,#8]);!$([CX4]-[CX4;!H0]-[CX3;!$(C-[O,N])]=[OX1]);!$([CX4]-[CX4]-[NX3;H1,H2;+0;!$(N-[C,S]=[O,S,N]);!$(N-c)]):1]([#6:3])([#6:4])[OX2H:2]",
    from = "[C:1]([#6:3])([#6:4])[O:2]C(=O)c1ccc(cc1)[N+](=O)[O-]",
    conditions = "base-aq-mild",
    also_attacks = { "other ester", "acyl halide", "anhydride" },
    recipe = "NaOH or K2CO3, aqueous MeOH, rt",
    yield = { 85, 98 },
    source = "Dodge, Nissen, Presnell, Org. Synth. Coll. Vol. 9, 607, makes such an ester; common practice",
    example { "CC(C)[C@@H]1CC[C@@H](C)C[C@@H]1O",
        from = { "CC(C)[C@@H]1CC[C@@H](C)C[C@@H]1OC(=O)c1ccc([N+](=O)[O-])cc1" } },
    refuse { "CCO" }, -- a primary alcohol needs no such detour
}

interconversion "succinic-acid-from-cyano-ester" {
    about = "Succinic acid from a 2,3-dicyano ester: both nitriles and the ester hydrolyse, one carboxyl group leaves",
    target = "[OX2H][CX3:1](=[OX1])[CX4;H2:2][CX4:3][CX3:4](=[OX1])[OX2H]",
    from = "CCO[C:1](=O)[C:2](C#N)[C:3][C:4]#N",
    conditions = "acid-aq-strong",
    also_attacks = { "acetal", "Boc carbamate", "tert-butyl ester", "silyl ether", "ester", "nitrile", "amide" },
    recipe = "conc. HCl, reflux; or 70 % H2SO4, 130 °C",
    yield = { 65, 88 },
    cautions = { "hydrochloric acid" },
    source = "Miller, Long, J. Am. Chem. Soc. 1951, 73, 4895; from memory",
    example { "CCC(C)(CC(=O)O)C(=O)O", from = { "CCOC(=O)C(C#N)C(C)(CC)C#N" } },
    example { "OC(=O)CC(C(=O)O)c1ccccc1", from = { "CCOC(=O)C(C#N)C(C#N)c1ccccc1" } },
    refuse { "OC(=O)CCCC(=O)O" }, -- a glutaric acid
}

interconversion "acetonedicarboxylic-acid" {
    about = "β-Keto acid by loss of carbon monoxide from a citric acid (α-hydroxy acid in fuming sulfuric acid)",
    target = "[OX2H:5][CX3:6](=[O:7])[CX4;H2:1][CX3:2](=[OX1:3])[CX4;H2:4][CX3:8](=[O:9])[OX2H:10]",
    from = "[O:5][C:6](=[O:7])[C:1][C:2]([O:3])(C(=O)O)[C:4][C:8](=[O:9])[O:10]",
    conditions = "so3",
    also_attacks = { "alcohol", "alkene", "arene", "acetal", "primary amine" },
    recipe = "20 % fuming H2SO4, -5 to 30 °C (carbon monoxide escapes), then ice",
    yield = { 80, 90 },
    cautions = { "oleum", "carbon monoxide" },
    source = "Adams, Chiles, Rassweiler, Org. Synth. Coll. Vol. 1, 10; from memory",
    example { "OC(=O)CC(=O)CC(=O)O", from = { "OC(=O)CC(O)(CC(=O)O)C(=O)O" } },
    refuse { "CC(=O)CC(=O)O" }, -- only citric acids, which are stable enough
}

interconversion "glutaraldehyde-from-alkoxydihydropyran" {
    about = "1,5-Dialdehyde from a 2-alkoxy-3,4-dihydro-2H-pyran",
    target = "[OX1:1]=[CX3;H1:2][CX4:3][CX4:4][CX4;H2:5][CX3;H1:6]=[OX1:7]",
    from = "CC[O:1][C:2]1[C:3][C:4][C:5]=[C:6][O:7]1",
    conditions = "acid-aq-mild",
    also_attacks = { "acetal", "silyl ether", "other enol ether" },
    recipe = "dil. HCl, H2O, rt; used in solution",
    yield = { 75, 95 },
    source = "Cope, Dryden, Howell, Org. Synth. Coll. Vol. 4, 816; from memory",
    example { "O=CCCCC=O", from = { "CCOC1CCC=CO1" } },
    example { "O=CCC(C)CC=O", from = { "CCOC1CC(C)C=CO1" } },
    refuse { "O=CCCC=O" }, -- four carbons: from a dimethoxytetrahydrofuran
}

interconversion "succinaldehyde-from-dimethoxytetrahydrofuran" {
    about = "1,4-Dialdehyde from a 2,5-dimethoxytetrahydrofuran",
    target = "[OX1:1]=[CX3;H1:2][CX4:3][CX4:4][CX3;H1:5]=[OX1:6]",
    from = "C[O:1][C:2]1[C:3][C:4][C:5](OC)[O:6]1",
    conditions = "acid-aq-mild",
    also_attacks = { "acetal", "silyl ether", "enol ether" },
    recipe = "0.1-1 M HCl, rt to 60 °C; used in solution",
    yield = { 75, 95 },
    source = "Fakstorp, Raleigh, Schniepp, J. Am. Chem. Soc. 1950, 72, 869; from memory",
    example { "O=CCCC=O", from = { "COC1CCC(OC)O1" } },
    refuse { "O=CCCCC=O" }, -- five carbons
}

interconversion "benzyl-ester-saponification" {
    about = "Saponification of a benzyl ester; nitro group and alkene, which hydrogenolysis would reduce, survive",
    target = "[#6;!$(N):1][C;X3:2](=[O;X1:3])[O;X2;H1:4]",
    from = "[#6:1][C;X3:2](=[O;X1:3])[O;X2;H0:4][C;H2]c1ccccc1",
    when = function(m) return m.molecule:has "[$([N+](=O)[O-]),$([CX3]=[CX3]),$(C#C)]" end,
    conditions = "base-aq-strong",
    also_attacks = { "epoxide", "alkyl halide" },
    recipe = "LiOH, THF/H2O, 20 °C, then acid; also: NaOH, MeOH/H2O",
    yield = { 80, 95 },
    cautions = { "lithium hydroxide" },
    source = "Wuts, Greene's Protective Groups in Organic Synthesis; from memory",
    example { "OC(=O)/C=C/c1ccc(cc1)[N+](=O)[O-]", from = { "O=C(OCc1ccccc1)/C=C/c1ccc(cc1)[N+](=O)[O-]" } },
    example { "OC(=O)/C=C/c1ccccc1", from = { "O=C(OCc1ccccc1)/C=C/c1ccccc1" } },
    refuse { "COC(=O)O" }, -- carbonic acid half-ester is not stable
}

interconversion "acid-from-dialkylamide" {
    about = "Hydrolysis of an N,N-dialkylamide to the acid; needs long heating; neighbouring OH or CHO helps",
    target = "[c;$(c:c-[OX2H]),$(c:c-[CX3;H1]=O),$(c:c-[CX4][OX2]),$(c:c-[SX2]):1][C;X3:2](=[O;X1:3])[O;X2;H1]",
    from = "[c:1][C;X3:2](=[O;X1:3])[N;X3]([C;H2][C;H3])[C;H2][C;H3]",
    conditions = "acid-aq-strong",
    also_attacks = { "aryl methyl ether" },
    recipe = "6 M HCl or HBr, reflux 24 h; also: dimethylamide",
    yield = { 55, 85 },
    cautions = { "hydrochloric acid", "hydrobromic acid" },
    source = "March's Advanced Organic Chemistry; from memory",
    example { "OC(=O)c1cc(Cl)ccc1O", from = { "CCN(CC)C(=O)c1cc(Cl)ccc1O" } },
    example { "OC(=O)c1ccccc1O", from = { "CCN(CC)C(=O)c1ccccc1O" } },
    refuse { "CC(C)(C)C(=O)O" }, -- no aryl group: this is the end of a directed metalation
}

interconversion "sulfanilamide-deacetylation" {
    about = "Removal of the acetyl group from a 4-acetamidobenzenesulfonamide; the sulfonamide is untouched",
    target = "[N;X3;H2:1]-[c;$(c1ccc(S(=O)(=O)[NX3])cc1):2]",
    from = "[N:1](C(C)=O)-[c:2]",
    conditions = "base-aq-strong",
    also_attacks = { "nitrile", "epoxide" },
    recipe = "aq. NaOH, 80-100 °C, then acid; also: HCl, reflux",
    yield = { 75, 90 },
    cautions = { "sodium hydroxide" },
    source = "Vogel's Textbook of Practical Organic Chemistry; from memory",
    example { "Nc1ccc(cc1)S(=O)(=O)Nc1nccs1", from = { "CC(=O)Nc1ccc(cc1)S(=O)(=O)Nc1nccs1" } },
    example { "Nc1ccc(cc1)S(N)(=O)=O", from = { "CC(=O)Nc1ccc(cc1)S(N)(=O)=O" } },
    refuse { "Nc1cccc(c1)S(N)(=O)=O" }, -- meta: chlorosulfonation of acetanilide gives para
}

interconversion "formamide-hydrolysis" {
    about = "Hydrolysis of a formamide to the amine; completes a Leuckart reaction",
    target = "[C;X4;H1:1]([#6:3])[N;X3;H2;+0:2]",
    from = "[C:1]([#6:3])[N:2]C=O",
    conditions = "acid-aq-strong",
    recipe = "conc. HCl, reflux 1 h, then NaOH",
    yield = { 75, 90 },
    cautions = { "sodium hydroxide", "hydrochloric acid" },
    source = "Vogel's Textbook of Practical Organic Chemistry; from memory",
    example { "CC(N)c1ccc(Br)cc1", from = { "CC(NC=O)c1ccc(Br)cc1" } },
    example { "CC(N)c1ccccc1", from = { "CC(NC=O)c1ccccc1" } },
    refuse { "CC(N)=O" }, -- an amide nitrogen, not an amine
}

interconversion "lactam-hydrolysis-gamma" {
    about = "Hydrolysis of a pyrrolidinone to the γ-amino acid",
    target = "[N;X3;H2:1][C;X4;H2:2][C;X4:3][C;X4:4][C;X3:5](=[O;X1:6])[O;X2;H1]",
    from = "[N;H1:1]1[C:2][C:3][C:4][C:5]1=[O:6]",
    conditions = "acid-aq-strong",
    recipe = "6 M HCl, reflux, isolated as hydrochloride",
    yield = { 80, 95 },
    cautions = { "hydrochloric acid" },
    source = "Kleemann and Engel, Pharmaceutical Substances; from memory",
    example { "NCC1(CC(=O)O)CCCCC1", from = { "O=C1CC2(CCCCC2)CN1" } },
    example { "NCCCC(=O)O", from = { "O=C1CCCN1" } },
    refuse { "NCCC(=O)O" }, -- the four-membered lactam is no practical precursor
}

interconversion "lactam-hydrolysis-epsilon" {
    about = "Hydrolysis of caprolactam to the ε-amino acid",
    target = "[N;X3;H2:1][C;X4;H2:2][C;X4:3][C;X4:4][C;X4:5][C;X4:6][C;X3:7](=[O;X1:8])[O;X2;H1]",
    from = "[N;H1:1]1[C:2][C:3][C:4][C:5][C:6][C:7]1=[O:8]",
    conditions = "acid-aq-strong",
    recipe = "conc. HCl, reflux",
    yield = { 80, 92 },
    cautions = { "hydrochloric acid" },
    source = "Vogel's Textbook of Practical Organic Chemistry; from memory",
    example { "NCCCCCC(=O)O", from = { "O=C1CCCCCN1" } },
    example { "NCCC(C)CCC(=O)O", from = { "CC1CCNC(=O)CC1" } },
    refuse { "NCCCCC(N)=O" }, -- a primary amide, not the acid
}

interconversion "guareschi-imide-hydrolysis" {
    about = "Hydrolysis and decarboxylation of a Guareschi imide to a 3,3-disubstituted glutaric acid; both nitriles leave as CO2",
    target = "[C;X4;H0:1]([C;X4;H2:2][C;X3:3](=[O;X1:4])[O;H1])[C;X4;H2:5][C;X3:6](=[O;X1:7])[O;H1]",
    from = "[C:1]1[C:2](C#N)[C:3](=[O:4])N[C:6](=[O:7])[C:5]1C#N",
    conditions = "acid-aq-strong",
    also_attacks = { "alkene", "free alcohol" },
    recipe = "65-70% H2SO4, 130-180 °C",
    yield = { 65, 85 },
    cautions = { "sulfuric acid" },
    source = "Kleemann and Engel, Pharmaceutical Substances; from memory",
    example { "OC(=O)CC1(CC(=O)O)CCCCC1", from = { "N#CC1C(=O)NC(=O)C(C#N)C12CCCCC2" } },
    example { "CCC(C)(CC(=O)O)CC(=O)O", from = { "CCC1(C)C(C#N)C(=O)NC(=O)C1C#N" } },
    refuse { "OC(=O)CCCC(=O)O" }, -- no quaternary carbon: made otherwise
}

interconversion "enol-ether-hydrolysis" {
    about = "Hydrolysis of a methyl enol ether to the homologous aldehyde",
    target = "[#6:1][C;X4;H2:2][C;X3;H1:3]=[O;X1]",
    from = "[#6:1][C;H1:2]=[C;H1:3]O[C;H3]",
    conditions = "acid-aq-mild",
    also_attacks = { "silyl ether" },
    recipe = "aq. HCl, THF, rt; also: HCO2H, TsOH in acetone/H2O, Hg(OAc)2",
    yield = { 70, 92 },
    cautions = { "hydrochloric acid" },
    source = "Carey and Sundberg, Advanced Organic Chemistry, Part B; from memory",
    example { "O=CCC1CCN(CC1)C(=O)c1ccccc1", from = { "COC=CC1CCN(CC1)C(=O)c1ccccc1" } },
    example { "O=CCc1ccccc1", from = { "COC=Cc1ccccc1" } },
    refuse { "CC(C)(C)C=O" }, -- alpha carbon carries no H
}

interconversion "enol-ether-hydrolysis-branched" {
    about = "Hydrolysis of a methyl enol ether to an α-branched aldehyde; equatorial aldehyde after equilibration",
    target = "[#6:1][C;X4;H1:2]([#6:4])[C;X3;H1:3]=[O;X1]",
    from = "[#6:1][C;H0:2]([#6:4])=[C;H1:3]O[C;H3]",
    conditions = "acid-aq-mild",
    also_attacks = { "silyl ether" },
    recipe = "3 M HCl, THF, rt; also: HCO2H, TFA/CH2Cl2/H2O",
    yield = { 70, 90 },
    cautions = { "hydrochloric acid" },
    source = "Carey and Sundberg, Advanced Organic Chemistry, Part B; from memory",
    example { "O=CC1CCC(CC1)c1ccc(F)cc1", from = { "COC=C1CCC(CC1)c1ccc(F)cc1" } },
    example { "O=CC1CCCCC1", from = { "COC=C1CCCCC1" } },
    refuse { "CC(C)(C=O)c1ccccc1" }, -- quaternary alpha carbon: no enol ether
}

interconversion "birch-enol-ether-hydrolysis" {
    about = "Enone from a Birch-reduced anisole; strong acid gives the conjugated enone, oxalic acid the β,γ-enone",
    target = "[O;X1]=[C;X3:1]1[C;X3;H1:6]=[C;X3;H1:5][C;X4;H1:4]([#6:8])[C;X4;H2:3][C;X4;H2:2]1",
    from = "[C;H3]O[C:1]1=[C;H1:2][C;H2:3][C;H0:4]([#6:8])=[C;H1:5][C;H2:6]1",
    conditions = "acid-aq-mild",
    also_attacks = { "silyl ether", "tertiary alcohol" },
    recipe = "3 M HCl, MeOH/H2O, rt to 60 °C",
    yield = { 70, 90 },
    cautions = { "hydrochloric acid" },
    source = "Carey and Sundberg, Advanced Organic Chemistry, Part B; from memory",
    example { "O=C1C=CC(CCO)CC1", from = { "COC1=CCC(CCO)=CC1" } },
    example { "CC1CCC(=O)C=C1", from = { "COC1=CCC(C)=CC1" } },
    refuse { "O=C1CCCCC1" }, -- no conjugated alkene
}

interconversion "cyanoacetate-acid-decarboxylation" {
    about = "Hydrolysis and decarboxylation of a cyanoacetate to the acid",
    target = "[#6;!$(C-[OX2H,NX3;H1,H2]):3][C;X4;H2:1][C;X3:2](=[O;X1])[O;X2;H1]",
    from = "[#6:3][C;H1:1](C#N)[C:2](=O)OCC",
    conditions = "base-aq-strong",
    also_attacks = { "acetonide", "allylic alcohol", "other nitrile", "amide", "alkyl halide" },
    recipe = "KOH, ethylene glycol, 190 °C; also: conc. HCl/AcOH reflux",
    yield = { 65, 85 },
    cautions = { "potassium hydroxide" },
    source = "March's Advanced Organic Chemistry; from memory",
    example { "COc1ccc(cc1)C(C)(C)CC(=O)O", from = { "CCOC(=O)C(C#N)C(C)(C)c1ccc(OC)cc1" } },
    example { "OC(=O)CC1CCCCC1", from = { "CCOC(=O)C(C#N)C1CCCCC1" } },
    refuse { "OC(=O)C(C)(C)C" }, -- quaternary alpha carbon
}

interconversion "cyanoacetate-nitrile-decarboxylation" {
    about = "Nitrile from a cyanoacetate (Krapcho decarboxylation); the nitrile survives",
    rxno = "RXNO:0000507",
    target = "[#6:4][C;X4;H2:1][C;X2:2]#[N:3]",
    from = "[#6:4][C;H1:1](C(=O)OCC)[C:2]#[N:3]",
    conditions = "heat-200",
    also_attacks = { "other activated ester", "aryl methyl ether", "alkyl halide" },
    recipe = "LiCl, DMSO, H2O, 140-160 °C; also: NaCl; or NaOH, then heat",
    yield = { 65, 88 },
    cautions = { "dimethyl sulfoxide" },
    source = "Kürti and Czakó, Strategic Applications of Named Reactions in Organic Synthesis; from memory",
    example { "CC(C)(C)OC(=O)N1CCC(CC#N)CC1", from = { "CCOC(=O)C(C#N)C1CCN(C(=O)OC(C)(C)C)CC1" } },
    example { "N#CCC1CCCCC1", from = { "CCOC(=O)C(C#N)C1CCCCC1" } },
    refuse { "CC(C)(C)C#N" }, -- quaternary alpha carbon
}

interconversion "malonate-hydrolysis-decarboxylation-branched" {
    about = "α-Branched carboxylic acid from a disubstituted malonic ester in one pot; racemic",
    rxno = "RXNO:0000107",
    target = "[#6;$(C);!$(C=[O,N]):3][C;X4;H1;!R:1]([#6;$(C);!$(C=[O,N]):5])[C;X3:2](=[O;X1:4])[O;X2;H1]",
    from = "[#6:3][C;H0:1]([#6:5])(C(=O)OCC)[C:2](=[O:4])OCC",
    conditions = "acid-aq-strong",
    recipe = "KOH, then H2SO4, 140-180 °C; also: HBr reflux",
    yield = { 65, 88 },
    cautions = { "sulfuric acid", "potassium hydroxide" },
    source = "Vogel's Textbook of Practical Organic Chemistry; from memory",
    example { "CCCC(CCC)C(=O)O", from = { "CCCC(CCC)(C(=O)OCC)C(=O)OCC" } },
    example { "CCC(CC)C(=O)O", from = { "CCOC(=O)C(CC)(CC)C(=O)OCC" } },
    refuse { "OC(=O)C(C)(C)C" }, -- quaternary alpha carbon
}

interconversion "tert-butyl-keto-ester-decarboxylation" {
    about = "Ketone from a tert-butyl β-keto ester",
    target = "[#6:1][C;X3:2](=[O;X1:3])[C;X4;H2;!R:4]-!@[C;X4;H2,H3:5]",
    from = "[#6:1][C:2](=[O:3])[C;H1:4]([C:5])C(=O)OC(C)(C)C",
    conditions = "acid-dry-strong",
    also_attacks = { "silyl ether" },
    recipe = "CF3CO2H, CH2Cl2, rt; also: TsOH, toluene, reflux",
    yield = { 75, 95 },
    cautions = { "trifluoroacetic acid" },
    source = "Carey and Sundberg, Advanced Organic Chemistry, Part B; from memory",
    example { "O=C(CCc1ccccn1)c1ccc(Cl)cc1", from = { "CC(C)(C)OC(=O)C(Cc1ccccn1)C(=O)c1ccc(Cl)cc1" } },
    example { "O=C(CCc1ccccc1)c1ccccc1", from = { "CC(C)(C)OC(=O)C(Cc1ccccc1)C(=O)c1ccccc1" } },
    refuse { "CC(=O)C(C)(C)C" }, -- alpha carbon carries no H
}

interconversion "furan-hydrolysis" {
    about = "1,4-Diketone by hydrolysis of a 2,5-disubstituted furan",
    target = "[#6:1][C;X3:2](=[O;X1:3])[C;X4;H2:4][C;X4;H2:5][C;X3:6](=[O;X1])[#6:7]",
    from = "[#6:1][c:2]1[o:3][c:6]([#6:7])[cH:5][cH:4]1",
    conditions = "acid-aq-strong",
    also_attacks = { "alkene" },
    recipe = "aq. H2SO4, AcOH, 100-120 °C; also: HCl, MeOH",
    yield = { 60, 85 },
    cautions = { "sulfuric acid" },
    source = "Joule and Mills, Heterocyclic Chemistry; from memory",
    example { "CC(=O)CCC(=O)CCc1ccccc1", from = { "Cc1ccc(CCc2ccccc2)o1" } },
    example { "CC(=O)CCC(C)=O", from = { "Cc1ccc(C)o1" } },
    refuse { "CC(=O)CCCC(C)=O" }, -- a 1,5-diketone
}

interconversion "thiol-from-thioacetate" {
    about = "Thiol by cleavage of a thioacetate; no inversion: the C-S bond is not touched",
    target = "[C;X4:1][S;X2;H1:2]",
    from = "[C:1][S;H0:2]C(C)=O",
    conditions = "base-aq-mild",
    also_attacks = { "alkyl halide", "enone", "epoxide", "disulfide" },
    recipe = "aq. NaOH or NH3/MeOH, under N2, 0 °C; also: NaOMe, thiobenzoate",
    yield = { 80, 95 },
    cautions = { "sodium hydroxide" },
    source = "Kleemann and Engel, Pharmaceutical Substances; from memory",
    example { "C[C@H](CS)C(=O)N1CCC[C@H]1C(=O)O", from = { "CC(=O)SC[C@@H](C)C(=O)N1CCC[C@H]1C(=O)O" } },
    example { "SCc1ccccc1", from = { "CC(=O)SCc1ccccc1" } },
    refuse { "Sc1ccccc1" }, -- aryl thiol: comes otherwise
}

interconversion "boronate-hydrolysis" {
    about = "Boronic acid from a pinacol boronate",
    target = "[c:1][B;X3:2]([O;H1])[O;H1]",
    from = "[c:1][B:2]1OC(C)(C)C(C)(C)O1",
    conditions = "periodate",
    also_attacks = { "primary amine", "acetal" },
    recipe = "NaIO4, HCl, THF/H2O, rt; also: BCl3; KHF2 then TMSCl/H2O",
    yield = { 75, 92 },
    cautions = { "sodium periodate", "hydrochloric acid" },
    source = "Larock, Comprehensive Organic Transformations; from memory",
    example { "OB(O)c1ccc(cc1)C(=O)N1CCOCC1", from = { "CC1(C)OB(OC1(C)C)c1ccc(cc1)C(=O)N1CCOCC1" } },
    example { "OB(O)c1ccccc1", from = { "CC1(C)OB(OC1(C)C)c1ccccc1" } },
    refuse { "CB(C)O" }, -- a borinic acid
}

interconversion "boronic-acid-oxidation" {
    about = "Phenol from an arylboronic acid; ipso",
    target = "[c;$(c1ccccc1):1][O;X2;H1]",
    from = "[c:1]B(O)O",
    conditions = "h2o2-base",
    also_attacks = { "imine", "thioether", "tertiary amine", "primary amine", "pyridine" },
    recipe = "H2O2, aq. NaOH, THF, 0 °C; also: boronate, Oxone, NaBO3",
    yield = { 80, 95 },
    cautions = { "sodium hydroxide", "hydrogen peroxide" },
    source = "Carey and Sundberg, Advanced Organic Chemistry, Part B; from memory",
    example { "N#Cc1ccc(O)c(Cl)c1", from = { "N#Cc1ccc(B(O)O)c(Cl)c1" } },
    example { "Oc1ccccc1", from = { "OB(O)c1ccccc1" } },
    refuse { "OCc1ccccc1" }, -- a benzylic alcohol, not a phenol
}

interconversion "nitrile-alcoholysis" {
    about = "Alcoholysis of a nitrile to an ester",
    rxno = "RXNO:0000362",
    target = "[#6;c,$([CX4;H1,H2]-c):1][C;X3:2](=[O;X1])-!@[O;X2:3][C;X4;H2,H3;$([CH3]),$(C[CH3]):4]",
    from = "[#6:1][C:2]#N.[O;H1:3][C:4]",
    conditions = "acid-hot-dry",
    also_attacks = { "other nitrile" },
    recipe = "H2SO4 or dry HCl, EtOH, reflux, then water; also: MeOH",
    yield = { 70, 90 },
    cautions = { "sulfuric acid", "hydrochloric acid" },
    source = "Vogel's Textbook of Practical Organic Chemistry; from memory",
    example { "CCOC(=O)Cc1ccc(OC)c(OC)c1", from = { "N#CCc1ccc(OC)c(OC)c1", "CCO" } },
    example { "CCOC(=O)Cc1ccccc1", from = { "N#CCc1ccccc1", "CCO" } },
    refuse { "CCOC(=O)OC" }, -- a carbonate
}

interconversion "oxindole-hydrolysis" {
    about = "2-Aminophenylacetic acid from an N-aryloxindole; isolated as the sodium salt",
    target = "[O;H1][C;X3:4](=[O:5])[C;X4;H2:6][c:1]:[c:2][N;X3;H1:3][c:7]",
    from = "[c:1]1:[c:2][N;H0:3]([c:7])[C:4](=[O:5])[C:6]1",
    conditions = "base-aq-strong",
    also_attacks = { "epoxide", "alkyl halide", "nitrile" },
    recipe = "NaOH, EtOH/H2O, reflux",
    yield = { 85, 97 },
    cautions = { "sodium hydroxide" },
    source = "Kleemann and Engel, Pharmaceutical Substances; from memory",
    example { "OC(=O)Cc1ccccc1Nc1c(Cl)cccc1Cl", from = { "O=C1Cc2ccccc2N1c1c(Cl)cccc1Cl" } },
    example { "OC(=O)Cc1ccccc1Nc1ccccc1", from = { "O=C1Cc2ccccc2N1c1ccccc1" } },
    refuse { "OC(=O)Cc1ccccc1N" }, -- a primary aniline closes again at once
}

interconversion "acetamidomalonate-hydrolysis" {
    about = "α-Amino acid from an alkylated acetamidomalonate; racemic",
    target = "[N;X3;H2:1][C;X4;H1:2]([C;X4;H2:5])[C;X3:3](=[O:4])[O;X2;H1]",
    from = "[N;H1:1](C(C)=O)[C;H0:2]([C:5])(C(=O)OCC)[C:3](=[O:4])OCC",
    conditions = "acid-aq-strong",
    recipe = "NaOH, reflux, then acid and heat; also: 6 M HCl or HBr reflux",
    yield = { 70, 90 },
    cautions = { "sodium hydroxide" },
    source = "Vogel's Textbook of Practical Organic Chemistry; from memory",
    example { "NC(Cc1c[nH]c2ccc(F)cc12)C(=O)O", from = { "CCOC(=O)C(Cc1c[nH]c2ccc(F)cc12)(NC(C)=O)C(=O)OCC" } },
    example { "NC(Cc1ccccc1)C(=O)O", from = { "CCOC(=O)C(Cc1ccccc1)(NC(C)=O)C(=O)OCC" } },
    refuse { "NC(C)(C)C(=O)O" }, -- quaternary amino acid
}

interconversion "aryl-acetate-hydrolysis" {
    about = "Phenol by cleavage of an aryl acetate; aryl ester before alkyl ester",
    rxno = "RXNO:0000430",
    target = "[c;$(c1ccccc1):1][O;X2;H1:2]",
    from = "[c:1][O;H0:2]C(C)=O",
    conditions = "base-aq-mild",
    also_attacks = { "enone", "alkyl halide" },
    recipe = "K2CO3, MeOH, 0 °C to rt; also: NH4OAc, imidazole, NaOH; aryl benzoate, pivalate",
    yield = { 85, 97 },
    source = "Wuts, Greene's Protective Groups in Organic Synthesis; from memory",
    example { "COC(=O)/C=C/c1ccc(O)c(OC)c1", from = { "COC(=O)/C=C/c1ccc(OC(C)=O)c(OC)c1" } },
    example { "Oc1ccccc1C=O", from = { "CC(=O)Oc1ccccc1C=O" } },
    refuse { "OCc1ccccc1" }, -- a benzylic alcohol, not a phenol
}

interconversion "imide-hydrolysis" {
    about = "Diacid by hydrolysis of a cyclic imide",
    target = "[O;X2;H1][C;X3:2](=[O:3])[C;X4:4][C;X4:5][C;X3:6](=[O:7])[O;X2;H1]",
    from = "[N;H1]1[C:2](=[O:3])[C:4][C:5][C:6]1=[O:7]",
    conditions = "acid-aq-strong",
    recipe = "6 M HCl, reflux; also: NaOH, then acid; N-substituted imide",
    yield = { 75, 92 },
    cautions = { "hydrochloric acid" },
    source = "March's Advanced Organic Chemistry; from memory",
    example { "OC(=O)CC(C(=O)O)c1ccc(Cl)cc1", from = { "O=C1CC(C(=O)N1)c1ccc(Cl)cc1" } },
    example { "CC(CC(=O)O)C(=O)O", from = { "CC1CC(=O)NC1=O" } },
    refuse { "OC(=O)CC(=O)O" }, -- malonic acid: no five-membered imide
}

interconversion "aryl-urea-hydrolysis" {
    about = "Amine by hydrolysis of a mono-substituted urea; configuration kept",
    target = "[C;X4;H1,H0:1][N;X3;H2;+0:2]",
    from = "[C:1][N;H1:2]C(=O)[N;H2]",
    conditions = "acid-aq-strong",
    recipe = "6 M HCl or KOH in ethylene glycol, reflux",
    yield = { 60, 85 },
    cautions = { "potassium hydroxide", "hydrochloric acid" },
    source = "March's Advanced Organic Chemistry; from memory",
    example { "CC(N)COc1c(C)cccc1C", from = { "CC(COc1c(C)cccc1C)NC(N)=O" } },
    example { "CC(C)(C)N", from = { "CC(C)(C)NC(N)=O" } },
    refuse { "CC(N)=O" }, -- an amide nitrogen, not an amine
}
