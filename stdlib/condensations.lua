-- Condensations of carbonyl compounds with arenes, phenols and carbon acids.
-- Yields are typical ranges and sources stand from memory unless a source says otherwise.

pack {
    name = "condensations",
    version = "0.1.0",
    licence = "CC0-1.0",
    about = "Condensations of carbonyl compounds with arenes, phenols and carbon acids",
    needs = { "synthons" },
}

disconnection "hydroxycoumarin-michael" {
    about = "Michael addition of 4-hydroxycoumarin to an enone; carbon attacks",
    target = "[OX2H:1]-[c:2]1:[c:3](:[c:4](=[OX1:5]):[o,n:6]:[c:7]:[c:8]:1)-!@[CX4;$(C-c):9]-[CX4;H1,H2:10]-[CX3;$(C([#6])[#6]):11]=[OX1:12]",
    cut = { 9, 3 },
    acceptor = { 9, "beta-acceptor" },
    donor = { 3, "arene" },
    conditions = "amine-rt",
    also_attacks = { "other enone", "acyl halide", "primary amine" },
    recipe = "piperidine or Et3N (cat.), water or EtOH, reflux; also: L-proline",
    yield = { 60, 85 },
    source = "Ikawa, Stahmann, Link, J. Am. Chem. Soc. 1944, 66, 902; from memory",
    example { "CC(=O)CC(c1ccccc1)c1c(O)c2ccccc2oc1=O", from = { "CC(=O)C=Cc1ccccc1", "Oc1cc(=O)oc2ccccc12" } },
    example { "O=C(CC(c1ccccc1)c1c(O)c2ccccc2oc1=O)c1ccccc1",
        from = { "O=C(C=Cc1ccccc1)c1ccccc1", "Oc1cc(=O)oc2ccccc12" } },
    refuse { "CC(c1ccccc1)c1c(O)c2ccccc2oc1=O" }, -- no carbonyl group that would make an acceptor
}

disconnection "fc-alkylation-lactone" {
    about = "Friedel-Crafts alkylation of an arene by a γ-aryl-γ-lactone",
    target = "[c;$(c1(-*):[cH]:[cH]:[cH]:[cH]:[cH]:1),$(c1:c:c:c(-[OX2,CX4,F,Cl]):c:c:1):1]-!@[CX4;H1:2](-[c:3])[CX4;H2:4][CX4;H2:5][CX3:6](=[OX1:7])[OX2H:8]",
    from = "[cH:1].[c:3][C:2]1[C:4][C:5][C:6](=[O:7])[O:8]1",
    conditions = "lewis-acid",
    also_attacks = { "alcohol", "primary amine", "alkene", "acetal" },
    recipe = "AlCl3, the arene as solvent, 0 °C to rt",
    yield = { 60, 90 },
    cautions = { "aluminium chloride" },
    source = "Kleemann and Engel, Pharmaceutical Substances; from memory",
    example { "OC(=O)CCC(c1ccc(Cl)c(Cl)c1)c1ccccc1", from = { "c1ccccc1", "O=C1CCC(c2ccc(Cl)c(Cl)c2)O1" } },
    example { "OC(=O)CCC(c1ccccc1)c1ccccc1", from = { "c1ccccc1", "O=C1CCC(c2ccccc2)O1" } },
    refuse { "OC(=O)CCCc1ccccc1" }, -- only one aryl group on the carbon
}

disconnection "fc-acylation-anhydride-aromatic" {
    about = "Friedel-Crafts acylation with phthalic anhydride",
    target = "[OX2H:1][CX3:2](=[OX1:3])-[c:4]:[c:5]-[CX3;!R:6](=[OX1:7])-!@[c;$(c1(-*):[cH]:[cH]:[cH]:[cH]:[cH]:1),$(c1:c:c:c(-[OX2,CX4,F,Cl,Br,NX3]):c:c:1):8]",
    from = "[O:1]1[C:2](=[O:3])-[c:4]:[c:5]-[C:6]1=[O:7].[cH:8]",
    conditions = "lewis-acid",
    also_attacks = { "alcohol", "primary amine", "alkene", "acetal" },
    recipe = "AlCl3 (2 equiv.), excess arene or CS2, 0-60 °C",
    yield = { 75, 97 },
    cautions = { "aluminium chloride" },
    source = "Vogel's Textbook of Practical Organic Chemistry; from memory",
    example { "O=C(O)c1ccccc1C(=O)c1ccccc1", from = { "O=C1OC(=O)c2ccccc12", "c1ccccc1" } },
    example { "Cc1ccc(cc1)C(=O)c1ccccc1C(=O)O", from = { "O=C1OC(=O)c2ccccc12", "Cc1ccccc1" } },
    refuse { "O=C(O)c1ccc(cc1)C(=O)c1ccccc1" }, -- acid and ketone are not ortho
}

disconnection "diaryl-ring-ketone-closure" {
    about = "Ring closure of an ortho-aryl or ortho-arylmethyl benzoic acid to the ring ketone (anthraquinone, fluorenone, dibenzosuberone)",
    target = "[CX3;R;r5,r6,r7:1](=[OX1])(-;@[c;$(c1ccccc1):2])-;@[c;$(c1ccccc1):3]",
    from = "([OH][C:1](=O)-[c:2].[cH:3])",
    conditions = "acid-aq-strong",
    also_attacks = { "alcohol", "ester", "nitrile", "acetal", "tert-butyl ester" },
    recipe = "polyphosphoric acid or conc. H2SO4, 80-160 °C; also: acid chloride, AlCl3",
    yield = { 65, 92 },
    cautions = { "polyphosphoric acid" },
    source = "Vogel's Textbook of Practical Organic Chemistry; from memory",
    example { "O=C1c2ccccc2CCc2ccccc12", from = { "OC(=O)c1ccccc1CCc1ccccc1" } },
    example { "O=C1c2ccccc2C(=O)c2ccccc12", from = { "OC(=O)c1ccccc1C(=O)c1ccccc1" } },
    refuse { "O=C(c1ccccc1)c1ccccc1" }, -- not in a ring
}

disconnection "phthalein" {
    about = "Phthalein from phthalic anhydride and a phenol; para positions",
    target = "[OX2;r5:1]1[CX3:2](=[OX1:3])-[c:4]:[c:5]-[CX4;H0:6]1(-[c;$(c1ccc([OX2H])cc1):7])-[c;$(c1ccc([OX2H])cc1):8]",
    from = "[O:1]1[C:2](=[O:3])-[c:4]:[c:5]-[C:6]1=O.[cH:7].[cH:8]",
    when = function(m) return m.atom[7].symmetry == m.atom[8].symmetry end,
    conditions = "acid-aq-strong",
    also_attacks = { "alcohol", "alkene", "acetal" },
    recipe = "conc. H2SO4 or ZnCl2, 120-180 °C",
    yield = { 60, 85 },
    cautions = { "sulfuric acid" },
    source = "Vogel's Textbook of Practical Organic Chemistry; from memory",
    example { "O=C1OC(c2ccc(O)cc2)(c2ccc(O)cc2)c2ccccc12",
        from = { "O=C1OC(=O)c2ccccc12", "Oc1ccccc1", "Oc1ccccc1" } },
    example { "Cc1cc(ccc1O)C1(OC(=O)c2ccccc12)c1ccc(O)c(C)c1",
        from = { "O=C1OC(=O)c2ccccc12", "Cc1ccccc1O", "Cc1ccccc1O" } },
    refuse { "O=C1OC(c2ccccc2)(c2ccccc2)c2ccccc12" }, -- no donor groups
}

disconnection "bisphenol" {
    about = "Two molecules of a phenol and a ketone or aldehyde; para positions",
    target = "[c;$(c1ccc([OX2H])cc1):1]-!@[CX4;!R:2](-!@[c;$(c1ccc([OX2H])cc1):3])",
    from = "[cH:1].[C:2]=O.[cH:3]",
    when = function(m) return m.atom[1].symmetry == m.atom[3].symmetry end,
    conditions = "acid-aq-strong",
    also_attacks = { "alkene", "alcohol", "acetal", "other ketone" },
    recipe = "conc. HCl or H2SO4, cat. thiol, 40-60 °C",
    yield = { 70, 92 },
    cautions = { "phenol" },
    source = "common practice, no source",
    example { "CC(C)(c1ccc(O)cc1)c1ccc(O)cc1", from = { "Oc1ccccc1", "CC(C)=O", "Oc1ccccc1" } },
    example { "CCC(C)(c1ccc(O)cc1)c1ccc(O)cc1", from = { "Oc1ccccc1", "CCC(C)=O", "Oc1ccccc1" } },
    refuse { "CC(C)(c1ccccc1)c1ccccc1" }, -- no hydroxyl groups
}

disconnection "diaryltrichloroethane" {
    about = "Two molecules of an arene and chloral (Baeyer condensation)",
    target = "[c;$(c1ccc([F,Cl,Br,CX4,OX2])cc1):1]-!@[CX4;H1:2](-!@[c;$(c1ccc([F,Cl,Br,CX4,OX2])cc1):3])-[CX4:4](Cl)(Cl)Cl",
    from = "[cH:1].[C:2](=O)[C:4](Cl)(Cl)Cl.[cH:3]",
    when = function(m) return m.atom[1].symmetry == m.atom[3].symmetry end,
    conditions = "acid-aq-strong",
    also_attacks = { "alkene", "alcohol", "acetal" },
    recipe = "conc. H2SO4 or oleum, 15-30 °C",
    yield = { 60, 80 },
    cautions = { "oleum", "chloral" },
    source = "common practice, no source",
    example { "Clc1ccc(cc1)C(c1ccc(Cl)cc1)C(Cl)(Cl)Cl", from = { "Clc1ccccc1", "O=CC(Cl)(Cl)Cl", "Clc1ccccc1" } },
    example { "COc1ccc(cc1)C(c1ccc(OC)cc1)C(Cl)(Cl)Cl", from = { "COc1ccccc1", "O=CC(Cl)(Cl)Cl", "COc1ccccc1" } },
    refuse { "ClC(Cl)(Cl)C(c1ccc([N+](=O)[O-])cc1)c1ccc([N+](=O)[O-])cc1" }, -- nitroarenes are not attacked
}

disconnection "triarylmethane-leuco" {
    about = "Two molecules of a dialkylaniline and an aromatic aldehyde; para positions",
    target = "[c;$(c1ccc([NX3;H0]([CX4])[CX4])cc1):1]-!@[CX4;H1:2](-[c:4])-!@[c;$(c1ccc([NX3;H0]([CX4])[CX4])cc1):3]",
    from = "[cH:1].[C:2](=O)[c:4].[cH:3]",
    when = function(m) return m.atom[1].symmetry == m.atom[3].symmetry end,
    conditions = "acid-hot-dry",
    also_attacks = { "other aldehyde", "acetal" },
    recipe = "ZnCl2 or H2SO4, 100 °C",
    yield = { 70, 90 },
    source = "common practice, no source",
    example { "CN(C)c1ccc(cc1)C(c1ccccc1)c1ccc(cc1)N(C)C",
        from = { "CN(C)c1ccccc1", "O=Cc1ccccc1", "CN(C)c1ccccc1" } },
    refuse { "c1ccc(cc1)C(c1ccccc1)c1ccccc1" }, -- no donor groups
}

disconnection "fc-acylation-salicylate" {
    about = "Friedel-Crafts acylation of a salicylic acid derivative; para to the hydroxyl group",
    target = "[c;$(c1ccc([OX2H])c([CX3](=O)[OX2,NX3])c1):1]-!@[CX3;!R:2](=[OX1:3])-[CX4:4]",
    cut = { 2, 1 },
    acceptor = { 2, "acyl" },
    donor = { 1, "arene" },
    conditions = "lewis-acid",
    also_attacks = { "alcohol", "primary amine", "acetal", "other electron-rich arene" },
    recipe = "AlCl3 (3-4 equiv.), CH2Cl2 or PhNO2, 0 °C to reflux",
    yield = { 60, 85 },
    cautions = { "aluminium chloride" },
    source = "Kleemann and Engel, Pharmaceutical Substances; from memory",
    example { "CC(=O)c1ccc(O)c(C(=O)OC)c1", from = { "CC(=O)Cl", "COC(=O)c1ccccc1O" } },
    example { "CC(=O)c1ccc(O)c(C(N)=O)c1", from = { "CC(=O)Cl", "NC(=O)c1ccccc1O" } },
    refuse { "CC(=O)c1cccc(C(=O)OC)c1" }, -- no hydroxyl group to activate the ring
}

disconnection "aminobenzophenone" {
    about = "2-Aminobenzophenone from a para-substituted aniline and an aroyl chloride; ortho to nitrogen",
    target = "[NX3;H2:1]-[c;$(c1ccc([F,Cl,Br,CX4])cc1):2]:[c:3]-!@[CX3;!R:4](=[OX1:5])-[c:6]",
    cut = { 4, 3 },
    acceptor = { 4, "acyl" },
    donor = { 3, "arene" },
    conditions = "lewis-acid",
    also_attacks = { "alcohol", "ester", "acetal", "nitrile" },
    recipe = "ZnCl2, 180-220 °C, then acid (the N-aroyl compound and a quinazoline are hydrolysed)",
    yield = { 45, 75 },
    cautions = { "zinc chloride" },
    source = "Sternbach, Reeder, Keller, Metlesics, J. Org. Chem. 1961, 26, 4488; from memory",
    example { "Nc1ccc(Cl)cc1C(=O)c1ccccc1", from = { "Nc1ccc(Cl)cc1", "O=C(Cl)c1ccccc1" } },
    example { "Cc1ccc(N)c(c1)C(=O)c1ccccc1", from = { "Cc1ccc(N)cc1", "O=C(Cl)c1ccccc1" } },
    refuse { "Nc1ccccc1C(=O)c1ccccc1" }, -- the para position is free and would be attacked
}

disconnection "phenol-alkylation-alkene" {
    about = "ortho-Alkylation of a phenol by an alkene",
    target = "[OX2H:1]-[c;$(c1ccccc1):2]:[c:3]-!@[CX4;!R;$(C([CH3])[CH3]);!$(C[!#6;!#1]):4]-[CX4;H3:5]",
    from = "[O:1]-[c:2]:[cH:3].[C:4]=[C:5]",
    conditions = "acid-aq-strong",
    also_attacks = { "other alkene", "alcohol", "acetal" },
    recipe = "alkene, cat. H2SO4, 60-70 °C (tertiary); aluminium phenoxide, 250 °C under pressure (isopropyl)",
    yield = { 60, 85 },
    source = "common practice, no source",
    example { "Cc1ccc(O)c(c1)C(C)(C)C", from = { "Cc1ccc(O)cc1", "CC(C)=C" } },
    example { "Cc1ccc(C(C)C)c(O)c1", from = { "Cc1cccc(O)c1", "CC=C" } },
    refuse { "Oc1ccccc1CCC" }, -- a primary cation rearranges
}

disconnection "pseudoionone-cyclisation" {
    about = "Acid cyclisation of a terpenoid trienone to a trimethylcyclohexenyl enone",
    target = "[CX3:1]1([CH3:2])=[CX3:3](-[CX3;!R:4]=[CX3;!R:5])[CX4:6]([CH3:7])([CH3:8])[CX4;H2:9][CX4;H2:10][CX4;H2:11]1",
    from = "[C:1]([C:2])(=[C:3]-[C:4]=[C:5])[C:11][C:10][C:9]=[C:6]([C:7])[C:8]",
    conditions = "acid-aq-strong",
    also_attacks = { "alcohol", "acetal", "ester" },
    recipe = "conc. H2SO4, AcOH, 0-10 °C; 85 % H3PO4 gives the α isomer",
    yield = { 60, 80 },
    cautions = { "sulfuric acid" },
    source = "Krishna, Joshi, Org. Synth. Coll. Vol. 5 (β-ionone), after Tiemann, Krüger; from memory",
    example { "CC(=O)C=CC1=C(C)CCCC1(C)C", from = { "CC(=O)C=CC=C(C)CCC=C(C)C" } },
    refuse { "CC1=C(C=C)CCCC1" }, -- no geminal methyl groups
}

disconnection "intramolecular-carbonyl-ene" {
    about = "Ring closure of an unsaturated aldehyde by the carbonyl-ene reaction (isopulegol)",
    target = "[OX2H:1][CX4;H1;r6:2]1[CX4:3][CX4:4][CX4:5][CX4:6][CX4;H1:7]1[CX3:8]([CX4:10])=[CX3;H2:9]",
    from = "[O:1]=[C:2][C:3][C:4][C:5][C:6][C:7]=[C:8]([C:10])[CH3:9]",
    conditions = "lewis-acid",
    also_attacks = { "other aldehyde", "alcohol", "acetal", "epoxide" },
    recipe = "ZnBr2 or an aluminium aryloxide, toluene, 0 °C; trans product favoured",
    yield = { 70, 95 },
    source = "March's Advanced Organic Chemistry; from memory",
    example { "CC1CCC(C(C)=C)C(O)C1", from = { "CC(CCC=C(C)C)CC=O" } },
    example { "OC1CCCCC1C(C)=C", from = { "CC(C)=CCCCCC=O" } },
    refuse { "C=C(C)C1CCCC1O" }, -- a five-membered ring
}

disconnection "citral-aldol" {
    about = "Aldol condensation of an enal with acetone",
    target = "[CX3:1]=[CX3;H1;!R:2]-[CX3;H1;!R:3]=[CX3;H1;!R:4]-[CX3:5](=[OX1:6])[CH3:7]",
    cut = { 3, 4 },
    acceptor = { 3, "alkylidene" },
    donor = { 4, "enolate" },
    conditions = "base-aq-mild",
    also_attacks = { "other aldehyde", "acyl halide" },
    recipe = "aq. NaOH or Ba(OH)2, excess acetone, 0-40 °C; E",
    yield = { 50, 80 },
    source = "Russell, Kenyon, Org. Synth. Coll. Vol. 3, 747; from memory",
    example { "CC(=O)C=CC=C(C)CCC=C(C)C", from = { "CC(C)=CCCC(C)=CC=O", "CC(C)=O" } },
    example { "CC(=O)C=CC=Cc1ccccc1", from = { "O=CC=Cc1ccccc1", "CC(C)=O" } },
    refuse { "CC(=O)C=CCC" }, -- the aldehyde would condense with itself
}

disconnection "acyl-lactam" {
    about = "Claisen acylation of a lactam by an ester",
    target = "[#6;c,CX4:1]-[CX3:2](=[OX1:3])-!@[CX4;H1;R:4]1[CX3;R:5](=[OX1:6])[NX3;H0;R:7][CX4:8][CX4:9]1",
    cut = { 2, 4 },
    acceptor = { 2, "acyl-ethyl-ester" },
    donor = { 4, "enolate" },
    conditions = "base-hindered",
    also_attacks = { "other ester", "aldehyde", "ketone", "free acid" },
    recipe = "NaH or NaOEt, toluene, reflux",
    yield = { 60, 85 },
    cautions = { "sodium hydride" },
    source = "Späth, Bretschneider, Ber. Dtsch. Chem. Ges. 1928, 61, 327; from memory",
    example { "CN1CCC(C1=O)C(=O)c1cccnc1", from = { "CCOC(=O)c1cccnc1", "CN1CCCC1=O" } },
    example { "CN1CCC(C1=O)C(=O)c1ccccc1", from = { "CCOC(=O)c1ccccc1", "CN1CCCC1=O" } },
    refuse { "CN1CCCC1=O" }, -- no acyl group
}

disconnection "arylmalonate-from-carbonate" {
    about = "Arylmalonate from an arylacetate and diethyl carbonate",
    target = "[c:1]-[CX4;H1:2]([CX3:3](=[OX1:4])[OX2:5][CH2:6][CH3:7])-!@[CX3:8](=[OX1:9])[OX2:10][CH2:11][CH3:12]",
    from = "[c:1]-[C:2][C:3](=[O:4])[O:5][C:6][C:7].CCO[C:8](=[O:9])[O:10][C:11][C:12]",
    conditions = "alkoxide",
    also_attacks = { "aldehyde", "ketone", "alkyl halide" },
    recipe = "NaOEt, diethyl carbonate (excess), ethanol distilled off",
    yield = { 75, 90 },
    source = "Wallingford, Homeyer, Jones, J. Am. Chem. Soc. 1941, 63, 2056; from memory",
    example { "CCOC(=O)C(C(=O)OCC)c1ccccc1", from = { "CCOC(=O)Cc1ccccc1", "CCOC(=O)OCC" } },
    example { "CCOC(=O)C(C(=O)OCC)c1ccc(F)cc1", from = { "CCOC(=O)Cc1ccc(F)cc1", "CCOC(=O)OCC" } },
    refuse { "CCOC(=O)CC(=O)OCC" }, -- no aryl group
}

disconnection "oxalate-claisen-ester" {
    about = "Claisen condensation of an ester with diethyl oxalate",
    target = "[CX3:1](=[OX1:2])([CX3](=O)O[CH2][CH3])-!@[CX4;H1,H2:3]-[CX3:4](=[OX1:5])-[OX2:6]",
    cut = { 1, 3 },
    acceptor = { 1, "acyl-ethyl-ester" },
    donor = { 3, "enolate" },
    conditions = "alkoxide",
    also_attacks = { "aldehyde", "ketone", "alkyl halide", "free acid" },
    recipe = "NaOEt, Et2O or toluene, rt",
    yield = { 65, 90 },
    source = "Vogel's Textbook of Practical Organic Chemistry; from memory",
    example { "CCOC(=O)C(=O)CC(=O)OCC", from = { "CCOC(=O)C(=O)OCC", "CCOC(C)=O" } },
    example { "CCOC(=O)C(=O)C(C(=O)OCC)c1ccccc1", from = { "CCOC(=O)C(=O)OCC", "CCOC(=O)Cc1ccccc1" } },
    refuse { "CCOC(=O)CC(=O)OCC" }, -- a malonate: no ketone
}

interconversion "oxaloester-decarbonylation" {
    about = "Malonate from an α-oxalyl ester by loss of carbon monoxide on heating",
    target = "[CX4;H1:1](-[c:2])([CX3:3](=[OX1:4])[OX2:5][CX4:6])[CX3:7](=[OX1:8])[OX2:9][CX4:10]",
    from = "[C:1](-[c:2])([C:3](=[O:4])[O:5][C:6])C(=O)[C:7](=[O:8])[O:9][C:10]",
    conditions = "heat-200",
    also_attacks = { "aldehyde" },
    recipe = "175 °C, powdered glass or iron (cat.), carbon monoxide escapes",
    yield = { 75, 90 },
    cautions = { "carbon monoxide" },
    source = "Levene, Meyer, Org. Synth. Coll. Vol. 2, 288; from memory",
    example { "CCOC(=O)C(C(=O)OCC)c1ccccc1", from = { "CCOC(=O)C(=O)C(C(=O)OCC)c1ccccc1" } },
    refuse { "CCOC(=O)C(C)C(=O)OCC" }, -- alkyl malonates are made by alkylation
}

disconnection "aldol-hydroxymethylation" {
    about = "Hydroxymethylation of an acylamino ketone or 1,3-dicarbonyl compound with formaldehyde",
    target = "[OX2H:1][CX4;H2:2]-!@[CX4;H1,H0;$(C([CX3]=O)[NX3;H1][CX3]=O),$(C([CX3]=O)[CX3]=O),$(C[N+](=O)[O-]):3]",
    cut = { 2, 3 },
    acceptor = { 2, "hydroxyalkyl" },
    donor = { 3, "stabilised-carbanion" },
    conditions = "base-aq-mild",
    also_attacks = { "aldehyde", "primary amine" },
    recipe = "aq. formaldehyde, NaHCO3 or K2CO3, EtOH, 30-40 °C",
    yield = { 60, 88 },
    cautions = { "formaldehyde" },
    source = "Long, Troutman, J. Am. Chem. Soc. 1949, 71, 2473; from memory",
    example { "CC(=O)NC(CO)C(=O)c1ccc([N+](=O)[O-])cc1", from = { "C=O", "CC(=O)NCC(=O)c1ccc([N+](=O)[O-])cc1" } },
    example { "CCOC(=O)C(C)(CO)C(=O)OCC", from = { "C=O", "CCOC(=O)C(C)C(=O)OCC" } },
    refuse { "OCC(C)C(=O)OC" }, -- a simple ester is not acidic enough
}

disconnection "methylene-ketone" {
    about = "α-Methylene ketone from a ketone and formaldehyde (through the Mannich base)",
    target = "[CX3;H2:1]=[CX3:2](-[CX4:5])-[CX3:3](=[OX1:4])-[#6;c,CX4:6]",
    cut = { 1, 2 },
    acceptor = { 1, "alkylidene" },
    donor = { 2, "enolate" },
    conditions = "acid-aq-mild",
    also_attacks = { "primary amine", "phenol", "indole", "other ketone", "aldehyde" },
    recipe = "paraformaldehyde, dialkylamine salt, AcOH or dioxane, reflux; also: Eschenmoser salt, then base",
    yield = { 50, 80 },
    cautions = { "formaldehyde" },
    source = "March's Advanced Organic Chemistry; from memory",
    example { "Cn1c2CCC(=C)C(=O)c2c2ccccc12", from = { "C=O", "Cn1c2CCCC(=O)c2c2ccccc12" } },
    example { "C=C1CCCCC1=O", from = { "C=O", "O=C1CCCCC1" } },
    refuse { "C=CC(=O)c1ccccc1" }, -- nothing on the α carbon
}

disconnection "acetoacetanilide" {
    about = "β-Keto amide from a β-keto ester and an amine",
    target = "[#6:1][CX3:2](=[OX1:3])[CX4:4][CX3:5](=[OX1:6])-!@[NX3;!$(N[#7,#8]):7]",
    cut = { 5, 7 },
    acceptor = { 5, "acyl-simple-ester" },
    donor = { 7, "amine" },
    conditions = "amine-heat",
    also_attacks = { "other ester", "aldehyde", "other primary amine", "acyl halide" },
    recipe = "xylene, 110-140 °C, alcohol distilled off; ethylenediamine or DMAP (cat.)",
    yield = { 65, 90 },
    source = "Vogel's Textbook of Practical Organic Chemistry; from memory",
    example { "CC(C)C(=O)CC(=O)Nc1ccccc1", from = { "COC(=O)CC(=O)C(C)C", "Nc1ccccc1" } },
    example { "CC(=O)CC(=O)Nc1ccccc1", from = { "CCOC(=O)CC(C)=O", "Nc1ccccc1" } },
    refuse { "CC(=O)NC" }, -- no keto group
}

disconnection "ketophosphonate" {
    about = "β-Keto phosphonate from an ester and an alkyl phosphonate",
    target = "[#6;c,CX4:1][CX3:2](=[OX1:3])-!@[CX4;H1,H2:4]-[PX4:5](=[OX1])([OX2][CX4])[OX2][CX4]",
    cut = { 2, 4 },
    acceptor = { 2, "acyl-simple-ester" },
    donor = { 4, "stabilised-carbanion" },
    conditions = "organolithium",
    also_attacks = { "aldehyde", "ketone", "free acid", "alkyl halide" },
    recipe = "dialkyl methylphosphonate, BuLi, THF, -78 °C, then the ester",
    yield = { 65, 90 },
    cautions = { "butyllithium" },
    source = "Corey, Kwiatkowski, J. Am. Chem. Soc. 1966, 88, 5654; from memory",
    example { "CCCCCC(=O)CP(=O)(OC)OC", from = { "CCCCCC(=O)OC", "COP(C)(=O)OC" } },
    example { "O=C(CP(=O)(OC)OC)c1ccccc1", from = { "COC(=O)c1ccccc1", "COP(C)(=O)OC" } },
    refuse { "CC(=O)P(=O)(OC)OC" }, -- an acyl phosphonate
}

disconnection "thioacetic-acid-addition" {
    about = "Conjugate addition of thioacetic acid to an acrylic acid, ester or amide",
    target = "[CH3:6][CX3:7](=[OX1:8])-[SX2:1]-!@[CX4;H2:2]-[CX4;H1,H2:3]-[CX3:4](=[OX1:5])[OX2,NX3:9]",
    cut = { 2, 1 },
    acceptor = { 2, "beta-acceptor" },
    donor = { 1, "thiol" },
    conditions = "amine-rt",
    also_attacks = { "other enone", "alkyl halide", "epoxide" },
    recipe = "thioacetic acid, neat or toluene, rt to 80 °C",
    yield = { 75, 95 },
    source = "Cushman, Cheung, Sabo, Ondetti, Biochemistry 1977, 16, 5484; from memory",
    example { "CC(CSC(C)=O)C(=O)O", from = { "C=C(C)C(=O)O", "CC(=O)S" } },
    example { "CC(=O)SCCC(=O)OC", from = { "C=CC(=O)OC", "CC(=O)S" } },
    refuse { "CC(=O)SCC(=O)O" }, -- sulfur on the α carbon
}

disconnection "imidazopyridine-mannich" {
    about = "Mannich reaction at C3 of an imidazo[1,2-a]pyridine",
    target = "[c;$(c1c(-*)nc2ccccn12):1]-!@[CX4;H2:2]-[NX3;H0;!$(N-[C,S]=O):3]",
    from = "[cH:1].[C:2]=O.[N:3]",
    conditions = "acid-aq-mild",
    also_attacks = { "primary amine", "phenol", "indole", "aldehyde" },
    recipe = "aq. formaldehyde, dialkylamine, AcOH, 60-100 °C",
    yield = { 65, 90 },
    cautions = { "formaldehyde" },
    source = "Kleemann and Engel, Pharmaceutical Substances; from memory",
    example { "Cc1ccc(cc1)-c1nc2ccc(C)cn2c1CN(C)C", from = { "Cc1ccc(cc1)-c1cn2cc(C)ccc2n1", "C=O", "CNC" } },
    example { "CN(C)Cc1c(nc2ccccn12)-c1ccccc1", from = { "c1ccc(cc1)-c1cn2ccccc2n1", "C=O", "CNC" } },
    refuse { "CN(C)Cc1ccccc1" }, -- a benzene ring
}

disconnection "benzylidenephthalide" {
    about = "Benzylidenephthalide from phthalic anhydride and an arylacetic acid",
    target = "[OX2:1]1[CX3:2](=[OX1:3])-[c:4]:[c:5]-[CX3:6]1=[CX3;H1:7]-[c:8]",
    from = "[O:1]1[C:2](=[O:3])-[c:4]:[c:5]-[C:6]1=O.OC(=O)[C:7]-[c:8]",
    conditions = "heat-200",
    also_attacks = { "alcohol", "primary amine", "ester" },
    recipe = "NaOAc (cat.), 230-260 °C, water and CO2 leave",
    yield = { 70, 85 },
    source = "Weiss, Org. Synth. Coll. Vol. 2, 61; from memory",
    example { "O=C1OC(=Cc2ccccc2)c2ccccc12", from = { "O=C1OC(=O)c2ccccc12", "OC(=O)Cc1ccccc1" } },
    refuse { "C=C1OC(=O)c2ccccc12" }, -- no aryl group
}

interconversion "nitroso-aminouracil" {
    about = "Nitrosation of a 6-aminouracil at C5",
    target = "[OX1:1]=[NX2:2]-[c;$(c1c([NX3])nc(=O)nc1=O),$(c1c([NX3])n(C)c(=O)n(C)c1=O):3]",
    from = "[cH:3]",
    conditions = "diazotisation",
    also_attacks = { "other primary amine", "secondary amine" },
    recipe = "NaNO2, aq. AcOH, 0-60 °C",
    yield = { 80, 97 },
    cautions = { "sodium nitrite" },
    source = "Traube, Ber. Dtsch. Chem. Ges. 1900, 33, 3035; from memory",
    example { "Cn1c(N)c(N=O)c(=O)n(C)c1=O", from = { "Cn1c(N)cc(=O)n(C)c1=O" } },
    refuse { "O=Nc1ccccc1" }, -- nitrosobenzene
}

interconversion "nitroso-reduction" {
    about = "Reduction of a nitroso group on an electron-rich ring to the amine",
    target = "[NX3;H2:1]-[c;$(c:c-[NX3,OX2]),$(c1:c:c:c(-[NX3;H0,OX2]):c:c:1),$(c(:c-[NX3]):c=O):2]",
    from = "[N:1](=O)-[c:2]",
    conditions = "zn-acid",
    also_attacks = { "nitro", "azide", "aldehyde" },
    recipe = "Na2S2O4, aq. NH3 or water, 60 °C; also: Zn, AcOH; H2, Pd/C",
    yield = { 80, 95 },
    source = "Traube, Ber. Dtsch. Chem. Ges. 1900, 33, 3035; from memory",
    example { "Cn1c(N)c(N)c(=O)n(C)c1=O", from = { "Cn1c(N)c(N=O)c(=O)n(C)c1=O" } },
    example { "CN(C)c1ccc(N)cc1", from = { "CN(C)c1ccc(N=O)cc1" } },
    refuse { "Nc1ccccc1" }, -- no donor that let the nitroso group in
}

interconversion "furfural-nitration" {
    about = "Nitration of furfural at C5 (as the diacetate)",
    target = "[c;$(c1ccc([CX3;H1]=O)o1):1]-[NX3+:2](=[OX1:3])-[O-:4]",
    from = "[cH:1].O[N+:2](=[O:3])[O-:4]",
    conditions = "nitration",
    also_attacks = { "alcohol", "amine", "alkene", "thioether" },
    recipe = "HNO3, Ac2O, -10 to 0 °C, then aq. acid frees the aldehyde",
    yield = { 45, 70 },
    cautions = { "nitric acid", "acetic anhydride" },
    source = "Gilman, Wright, J. Am. Chem. Soc. 1930, 52, 2550; from memory",
    example { "O=Cc1ccc([N+](=O)[O-])o1", from = { "O=Cc1ccco1", "O[N+](=O)[O-]" } },
    refuse { "O=[N+]([O-])c1ccoc1" }, -- β position
}

interconversion "pyrazole-nitration" {
    about = "Nitration of a pyrazole at C4",
    target = "[c;$(c1cnnc1);R1:1]-[NX3+:2](=[OX1:3])-[O-:4]",
    from = "[cH:1].O[N+:2](=[O:3])[O-:4]",
    conditions = "nitration",
    also_attacks = { "alcohol", "amine", "alkene", "thioether", "other electron-rich arene" },
    recipe = "HNO3, H2SO4, 50-100 °C",
    yield = { 70, 95 },
    cautions = { "nitric acid", "sulfuric acid" },
    source = "Joule, Mills, Heterocyclic Chemistry; from memory",
    example { "CCCc1nn(C)c(C(=O)O)c1[N+](=O)[O-]", from = { "CCCc1cc(C(=O)O)n(C)n1", "O[N+](=O)[O-]" } },
    example { "O=[N+]([O-])c1cn[nH]c1", from = { "c1cn[nH]c1", "O[N+](=O)[O-]" } },
    refuse { "Cn1ccc([N+](=O)[O-])n1" }, -- C3: a neighbour of nitrogen
}

disconnection "erlenmeyer-azlactone" {
    about = "Erlenmeyer azlactone from an aromatic aldehyde and an acylglycine; Z",
    target = "[c:1]-[CX3;H1:2]=[CX3:3]1-[CX3:4](=[OX1:5])-[OX2:6]-[CX3:7](-[#6:8])=[NX2:9]-1",
    from = "[c:1][C:2]=O.[C:3]([N:9][C:7](=[O:6])[#6:8])[C:4](=[O:5])O",
    conditions = "acylation",
    also_attacks = { "alcohol", "phenol", "primary amine", "other aldehyde" },
    recipe = "NaOAc, Ac2O, 100 °C",
    yield = { 60, 85 },
    cautions = { "acetic anhydride" },
    source = "Buck, Ide, Org. Synth. Coll. Vol. 2, 55; from memory",
    example { "O=C1OC(c2ccccc2)=NC1=Cc1ccc(OC)c(OC)c1", from = { "O=Cc1ccc(OC)c(OC)c1", "O=C(O)CNC(=O)c1ccccc1" } },
    example { "CC1=NC(=Cc2ccccc2)C(=O)O1", from = { "O=Cc1ccccc1", "CC(=O)NCC(=O)O" } },
    refuse { "CC1=NCC(=O)O1" }, -- no arylidene group
}

interconversion "azlactone-hydrolysis" {
    about = "α-Acylamino cinnamic acid from an azlactone by mild hydrolysis",
    target = "[c:1][CX3;H1:2]=[CX3:3]([NX3;H1:9][CX3:7](=[OX1:6])[#6:8])[CX3:4](=[OX1:5])[OX2H]",
    from = "[c:1][C:2]=[C:3]1[C:4](=[O:5])[O:6][C:7]([#6:8])=[N:9]1",
    conditions = "base-aq-mild",
    also_attacks = { "other ester", "acyl halide", "anhydride" },
    recipe = "water-acetone, reflux, or 1 % NaOH, warm",
    yield = { 80, 95 },
    source = "Herbst, Shemin, Org. Synth. Coll. Vol. 2, 1; from memory",
    example { "CC(=O)NC(=Cc1ccccc1)C(=O)O", from = { "CC1=NC(=Cc2ccccc2)C(=O)O1" } },
    example { "O=C(NC(=Cc1ccccc1)C(=O)O)c1ccccc1", from = { "O=C1OC(c2ccccc2)=NC1=Cc1ccccc1" } },
    refuse { "CC(=O)NCC(=O)O" }, -- no double bond
}

disconnection "chroman-from-allylic-alcohol" {
    about = "2,2-Disubstituted chroman from a phenol and a tertiary allylic alcohol (vitamin E type)",
    target = "[OX2;r6:1]1-[c:2]:[c:3]-[CX4;H2:4]-[CX4;H2:5]-[CX4;H0:6]1(-[CH3:7])-[CX4:8]",
    from = "[O:1]-[c:2]:[cH:3].[C:4]=[C:5]-[C:6](O)(-[C:7])-[C:8]",
    conditions = "lewis-acid",
    also_attacks = { "other alkene", "alcohol", "acetal" },
    recipe = "ZnCl2 or BF3·OEt2, HCl, toluene or AcOEt, 40-100 °C",
    yield = { 65, 92 },
    cautions = { "zinc chloride" },
    source = "Karrer, Fritzsche, Ringier, Salomon, Helv. Chim. Acta 1938, 21, 520; from memory",
    example { "Cc1c(C)c2OC(C)(CCCC(C)C)CCc2c(C)c1O", from = { "Cc1cc(O)c(C)c(C)c1O", "C=CC(C)(O)CCCC(C)C" } },
    example { "CC1(C)CCc2cc(O)ccc2O1", from = { "Oc1ccc(O)cc1", "C=CC(C)(C)O" } },
    refuse { "C1Cc2ccccc2OC1" }, -- no geminal groups
}

disconnection "picoline-condensation" {
    about = "Condensation of 2- or 4-methylpyridine (or quinoline) with an aromatic aldehyde; E",
    target = "[c;$(c1nc[c,n]cc1),$(c1ccncc1),$(c1nc2ccccc2cc1):1]/?[CX3;H1:2]=[CX3;H1:3]/?[c:4]",
    cut = { 3, 2 },
    acceptor = { 3, "alkylidene" },
    donor = { 2, "stabilised-carbanion" },
    conditions = "acid-hot-dry",
    also_attacks = { "other aldehyde", "alcohol", "primary amine" },
    recipe = "Ac2O or ZnCl2, reflux; also: KOtBu, DMF",
    yield = { 55, 85 },
    cautions = { "acetic anhydride" },
    source = "Joule, Mills, Heterocyclic Chemistry; from memory",
    example { "C(=Cc1ccccn1)c1ccccc1", from = { "O=Cc1ccccc1", "Cc1ccccn1" } },
    example { "C(=Cc1ccncc1)c1ccccc1", from = { "O=Cc1ccccc1", "Cc1ccncc1" } },
    refuse { "C(=Cc1cccnc1)c1ccccc1" }, -- 3-methylpyridine is not acidic enough
}
