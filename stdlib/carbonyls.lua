-- Aldehydes, ketones and their nitrogen derivatives.
-- Yields are typical ranges and sources stand from memory unless a source says otherwise.

pack {
    name = "carbonyls",
    version = "0.1.0",
    licence = "CC0-1.0",
    about = "Aldehydes, ketones and their nitrogen derivatives",
    needs = { "synthons" },
}

interconversion "dess-martin-ketone" {
    about = "Dess-Martin ketone oxidation; no epimerisation; neutral",
    rxno = "RXNO:0000576",
    target = "[#6:3][C;X3;H0:1](=[O;X1:2])[#6:4]",
    from = "[#6:3][C;X4;H1:1]([O;X2;H1:2])[#6:4]",
    conditions = "swern-dmp",
    also_attacks = { "free alcohol", "thiol", "thioether", "primary amine", "secondary amine" },
    recipe = "Dess-Martin periodinane, CH2Cl2, 0 °C to rt; also: Swern, TEMPO-NaOCl, IBX",
    yield = { 80, 95 },
    cautions = { "Dess-Martin periodinane" },
    source = "D. B. Dess and J. C. Martin, J. Org. Chem. 1983, 48, 4155; from memory",
    example { "CC(C)(C)OC(=O)N1CCCC(=O)C1", from = { "CC(C)(C)OC(=O)N1CCCC(O)C1" } },
    refuse { "COC(C)=O" }, -- ester carbonyl does not come from an alcohol
}

interconversion "swern-aldehyde" {
    about = "Swern oxidation; stops at the aldehyde; alpha centre mostly kept",
    rxno = "RXNO:0000154",
    target = "[C;X4:1][C;X3;H1:2]=[O;X1:3]",
    from = "[C;X4:1][C;X4;H2:2][O;X2;H1:3]",
    conditions = "swern-dmp",
    also_attacks = { "free alcohol", "thiol", "thioether", "primary amine", "secondary amine" },
    recipe = "(COCl)2, DMSO, CH2Cl2, -78 °C, then Et3N; also: Dess-Martin periodinane, TEMPO-NaOCl",
    yield = { 80, 97 },
    cautions = { "oxalyl chloride", "dimethyl sulfide" },
    source = "A. J. Mancuso and D. Swern, Synthesis 1981, 165; from memory",
    example { "CC(C)(C)OC(=O)NCCCC=O", from = { "CC(C)(C)OC(=O)NCCCCO" } },
    refuse { "CC(C)C(=O)C" }, -- ketone comes from a secondary alcohol
}

disconnection "oxime-formation" {
    about = "Oxime formation; E/Z mixture; E favoured for aldoximes",
    target = "[#6:1][C;X3;!$(C[#7,#8,#16]):2]=[N;X2:3][O;X2;H1:4]",
    from = "[#6:1][C;X3:2]=[O;X1].[N;X3;H2:3][O;X2;H1:4]",
    conditions = "amine-rt",
    also_attacks = { "aldehyde", "ketone", "acyl halide", "enone", "anhydride" },
    recipe = "NH2OH·HCl, NaOAc, EtOH-H2O, rt to reflux",
    yield = { 85, 98 },
    cautions = { "hydroxylamine hydrochloride" },
    source = "Clayden, Greeves, Warren, Organic Chemistry; from memory",
    example { "ON=C1CCN(CC1)C(=O)OC(C)(C)C", from = { "O=C1CCN(CC1)C(=O)OC(C)(C)C", "NO" } },
    refuse { "CO/N=C(/C)C" }, -- O-alkyl oxime needs an alkoxyamine
}

disconnection "hydrazone-formation" {
    about = "Hydrazone formation; terminal NH2 condenses; E favoured",
    target = "[#6:1][C;X3;!$(C[#7,#8,#16]):2]=[N;X2:3]-!@[N;X3;H1;!$(NC=[O,S]):4][#6:5]",
    from = "[#6:1][C;X3:2]=[O;X1].[N;X3;H2:3][N;X3;H1:4][#6:5]",
    conditions = "amine-rt",
    also_attacks = { "aldehyde", "ketone", "acyl halide", "enone", "anhydride" },
    recipe = "hydrazine, AcOH or H2SO4 (cat), EtOH, rt to reflux",
    yield = { 80, 97 },
    cautions = { "hydrazine", "sulfuric acid" },
    source = "Clayden, Greeves, Warren, Organic Chemistry; from memory",
    example { "C/C(=N\\Nc1ccc(cc1[N+](=O)[O-])[N+](=O)[O-])c1ccccc1", from = { "CC(=O)c1ccccc1", "NNc1ccc(cc1[N+](=O)[O-])[N+](=O)[O-]" } },
    refuse { "CC(C)=NNC(N)=O" }, -- semicarbazone (own rule)
}

disconnection "imine-formation" {
    about = "Imine formation (carbonyl compound to imine conversion); E; remove water",
    rxno = "RXNO:0000367",
    target = "[#6:1][C;X3;!$(C[#7,#8,#16]):2]=[N;X2:3]-!@[#6;!$(C=[O,N,S]):4]",
    from = "[#6:1][C;X3:2]=[O;X1].[N;X3;H2:3][#6:4]",
    conditions = "amine-rt",
    also_attacks = { "aldehyde", "ketone", "acyl halide", "enone", "anhydride" },
    recipe = "EtOH or toluene, MgSO4 or 4 Å sieves, AcOH (cat), rt to reflux",
    yield = { 80, 97 },
    source = "Clayden, Greeves, Warren, Organic Chemistry; from memory",
    example { "COc1ccc(cc1)/N=C/c1ccccc1Cl", from = { "O=Cc1ccccc1Cl", "COc1ccc(N)cc1" } },
    refuse { "CN(C)C=NC" }, -- amidine carbon bears a second nitrogen
}

interconversion "alkyne-hydration" {
    about = "Mercury-catalysed hydration of a terminal alkyne; Markovnikov: methyl ketone",
    target = "[#6:1][C;X3;H0:2](=[O;X1])[C;X4;H3:3]",
    from = "[#6:1][C;X2;H0:2]#[C;X2;H1:3]",
    conditions = "acid-aq-mild",
    also_attacks = { "alkyne", "alkene", "acetal", "silyl ether", "epoxide", "thiol" },
    recipe = "HgSO4 (cat), H2SO4, MeOH-H2O, 60 °C; also: Au(I) catalyst, MeOH-H2O",
    yield = { 65, 90 },
    cautions = { "mercury(II) sulfate", "sulfuric acid" },
    source = "Org. Synth. Coll. Vol. 4 (1-acetylcyclohexanol); from memory",
    example { "CC(=O)C1(O)CCCCC1", from = { "C#CC1(O)CCCCC1" } },
    refuse { "CC(=O)OC" }, -- ester carbonyl
}

interconversion "ozonolysis-terminal-alkene" {
    about = "Ozonolysis of a terminal alkene (alkene oxidative cleavage); both alkene carbons become C=O; reductive work-up",
    rxno = "RXNO:0000344",
    target = "[#6:1][C;X3;H1:2]=[O;X1]",
    from = "[#6:1][C;X3;H1:2]=[C;X3;H2]",
    conditions = "ozone",
    also_attacks = { "alkene", "alkyne", "thioether", "thiol", "primary amine", "secondary amine",
        "tertiary amine", "enol ether" },
    recipe = "O3, CH2Cl2-MeOH, -78 °C, then Me2S or PPh3; also: OsO4 (cat), NaIO4",
    yield = { 70, 90 },
    cautions = { "ozone", "ozonides", "triphenylphosphine" },
    source = "Clayden, Greeves, Warren, Organic Chemistry; from memory",
    example { "COC(=O)CCCCCCCC=O", from = { "COC(=O)CCCCCCCC=C" } },
    refuse { "COC(=O)CCCC(C)=O" }, -- ketone needs a 1,1-disubstituted alkene
}

interconversion "aldehyde-from-ester" {
    about = "Ester to aldehyde reduction with DIBAL; stops at the tetrahedral intermediate below -70 °C; over-reduction is the rival",
    target = "[C;X4:1][C;X3;H1:2]=[O;X1:3]",
    from = "[C;X4:1][C;X3;H0:2](=[O;X1:3])[O;X2][C;H3]",
    conditions = "dibal",
    also_attacks = { "aldehyde", "ketone", "ester", "free acid", "amide", "nitrile", "acyl halide",
        "epoxide" },
    recipe = "DIBAL-H (1.1 equiv), toluene or CH2Cl2, -78 °C, quench cold; also: ethyl ester",
    yield = { 65, 88 },
    cautions = { "diisobutylaluminium hydride" },
    source = "P. Garner and J. M. Park, J. Org. Chem. 1987, 52, 2361; from memory",
    example { "CC(C)(C)OC(=O)N1[C@H](C=O)COC1(C)C", from = { "CC(C)(C)OC(=O)N1[C@H](C(=O)OC)COC1(C)C" } },
    refuse { "CC(C)=O" }, -- ketone carbon bears no H
}

interconversion "aldehyde-from-nitrile" {
    about = "Nitrile to aldehyde reduction with DIBAL; imine is hydrolysed on work-up",
    target = "[#6:1][C;X3;H1:2]=[O;X1]",
    from = "[#6:1][C;X2;H0:2]#[N;X1]",
    conditions = "dibal",
    also_attacks = { "aldehyde", "ketone", "ester", "free acid", "amide", "acyl halide", "epoxide" },
    recipe = "DIBAL-H, toluene or CH2Cl2, -78 to 0 °C, then aqueous acid; also: Raney Ni, HCO2H (Stephen: SnCl2, HCl)",
    yield = { 65, 90 },
    cautions = { "diisobutylaluminium hydride" },
    source = "Larock, Comprehensive Organic Transformations; from memory",
    example { "O=Cc1ccc(Br)cc1F", from = { "N#Cc1ccc(Br)cc1F" } },
    refuse { "CC(C)=O" }, -- ketone needs an organometallic and the nitrile
}
