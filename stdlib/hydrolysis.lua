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
    target = "[#6:1][C;X3:2](=[O;X1:3])[O;X2;H1]",
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
    target = "[#6:3][C;X4;H2:1][C;X3:2](=[O;X1:4])[O;X2;H1]",
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
    target = "[CX4;H1;!$(C([#8])[#7,#8]):1]([#6:3])([#6:4])[OX2H:2]",
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
