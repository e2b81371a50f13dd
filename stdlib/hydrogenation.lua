-- Hydrogenation and hydrogenolysis.
-- Yields are typical ranges and sources stand from memory unless a source says otherwise.

pack {
    name = "hydrogenation",
    version = "0.1.0",
    licence = "CC0-1.0",
    about = "Hydrogenation and hydrogenolysis",
    needs = { "synthons" },
}

interconversion "pyridine-hydrogenation" {
    about = "2-Substituted piperidine by hydrogenation of a pyridine; racemic; phenyl survives under mild conditions",
    rxno = "RXNO:0000352",
    target = "[N;X3;H1;R1:1]1[C;X4;H1;R1:2]([#6:7])[C;X4;H2;R1:3][C;X4;H2;R1:4][C;X4;H2;R1:5][C;X4;H2;R1:6]1",
    from = "[n;H0:1]1[c;H0:2]([#6:7])[c:3][c:4][c:5][c:6]1",
    conditions = "h2-pd",
    also_attacks = { "alkene", "alkyne", "nitro", "azide", "imine", "aryl bromide", "aryl iodide",
        "benzyl ether", "benzyl ester", "Cbz amine", "ketone" },
    recipe = "H2 (3-50 bar), PtO2, AcOH or HCl/MeOH, rt; also: Rh/C",
    yield = { 80, 95 },
    cautions = { "hydrochloric acid", "hydrogen" },
    source = "Kleemann and Engel, Pharmaceutical Substances; from memory",
    example { "COC(=O)C(c1ccccc1)C1CCCCN1", from = { "COC(=O)C(c1ccccc1)c1ccccn1" } },
    refuse { "CC1(C)CCCCN1" }, -- quaternary ring carbon
}

interconversion "arylidene-hydrogenation" {
    about = "Hydrogenation of an arylidene ketone, ester or lactam; the carbonyl survives over palladium",
    rxno = "RXNO:0000339",
    target = "[c:3][C;X4;H2:1]-!@[C;X4;H1:2]([C;X3:4]=[O;X1:6])[#6:5]",
    from = "[c:3][C;H1:1]=[C;H0:2]([C:4]=[O:6])[#6:5]",
    conditions = "h2-pd",
    also_attacks = { "alkene", "alkyne", "nitro", "azide", "imine", "aryl bromide", "aryl iodide",
        "benzyl ether", "benzyl ester", "Cbz amine" },
    recipe = "H2 (1 bar), Pd/C, EtOAc or THF, rt",
    yield = { 85, 97 },
    cautions = { "hydrogen", "palladium on carbon" },
    source = "Kleemann and Engel, Pharmaceutical Substances; from memory",
    example { "COc1cc2c(cc1OC)C(=O)C(Cc1ccncc1)C2", from = { "COc1cc2c(cc1OC)C(=O)C(=Cc1ccncc1)C2" } },
    refuse { "CC(C)(Cc1ccccc1)C=O" }, -- quaternary alpha carbon
}

interconversion "resorcinol-partial-hydrogenation" {
    about = "Cyclohexane-1,3-dione by partial hydrogenation of a resorcinol; stops at the enolate of the dione",
    target = "[O;X1:1]=[C;X3;R1:2]1[C;X4;H1,H2;R1:3][C;X3;R1:4](=[O;X1:5])[C;X4;H2;R1:6][C;X4;H1,H2;R1:7][C;X4;H2;R1:8]1",
    from = "[O:1][c:2]1[c:3][c:4]([O:5])[c:6][c:7][c:8]1",
    conditions = "h2-raney",
    also_attacks = { "alkene", "alkyne", "nitro", "azide", "imine", "aryl bromide", "aryl iodide",
        "benzyl ether", "benzyl ester", "Cbz amine", "ketone", "aldehyde", "aryl chloride" },
    recipe = "H2 (50-80 bar), Raney nickel, aq. NaOH, 50 °C",
    yield = { 75, 90 },
    cautions = { "sodium hydroxide", "hydrogen", "nickel (Raney)" },
    source = "Vogel's Textbook of Practical Organic Chemistry; from memory",
    example { "CC1C(=O)CCCC1=O", from = { "Cc1c(O)cccc1O" } },
    refuse { "CC1(C)C(=O)CCCC1=O" }, -- no H between the two carbonyl groups
}

interconversion "cbz-benzyl-ester-hydrogenolysis" {
    about = "Removal of Cbz and benzyl ester from a dipeptide in one step; no racemisation",
    target = "[N;X3;H2:1][C;X4:2][C;X3:3](=[O:4])[N;X3:5][C;X4:6][C;X3:7](=[O:8])[O;X2;H1:9]",
    from = "[N:1](C(=O)OCc1ccccc1)[C:2][C:3](=[O:4])[N:5][C:6][C:7](=[O:8])[O;H0:9]Cc1ccccc1",
    conditions = "h2-pd",
    also_attacks = { "alkene", "alkyne", "nitro", "azide", "imine", "aryl bromide", "aryl iodide",
        "benzyl ether", "benzyl ester", "Cbz amine" },
    recipe = "H2 (1 bar), Pd/C, MeOH/AcOH, rt",
    yield = { 88, 98 },
    cautions = { "hydrogen", "palladium on carbon" },
    source = "Wuts, Greene's Protective Groups in Organic Synthesis; from memory",
    example { "C[C@H](N)C(=O)N1CCC[C@H]1C(=O)O", from = { "C[C@H](NC(=O)OCc1ccccc1)C(=O)N1CCC[C@H]1C(=O)OCc1ccccc1" } },
    refuse { "NCC(=O)NCC(N)=O" }, -- an amide end
}

interconversion "benzylidene-ketone-hydrogenation" {
    about = "Hydrogenation of the C=C of a benzylidene ketone; the ketone stays",
    target = "[c:1][CX4;H2:2]-!@[CX4;H2:3][CX3;$(C([#6])[#6]):4]=[OX1:5]",
    from = "[c:1]/[CX3;H1:2]=[CX3;H1:3]/[C:4]=[O:5]",
    conditions = "h2-pd",
    also_attacks = { "other alkene", "alkyne", "nitro", "azide", "benzyl ether", "aryl bromide" },
    recipe = "H2 (1 bar), 5 % Pd/C, EtOAc, rt, stopped after one equivalent",
    yield = { 85, 97 },
    cautions = { "hydrogen", "palladium on carbon" },
    source = "common practice, no source",
    example { "CC(=O)CCc1ccc(O)cc1", from = { "CC(=O)/C=C/c1ccc(O)cc1" } },
    refuse { "CC(=O)Cc1ccccc1" }, -- no carbon between the ring and the one beside the carbonyl group
}

interconversion "cbz-and-benzyl-ester-hydrogenolysis" {
    about = "Hydrogenolysis of a benzyl carbamate and a benzyl ester of one molecule in one operation",
    target = "([NX3;H2:1][CX4:2].[CX3:3](=[OX1:4])[OX2H:5])",
    from = "([N:1](C(=O)OCc1ccccc1)[C:2].[C:3](=[O:4])[O:5]Cc1ccccc1)",
    conditions = "h2-pd",
    also_attacks = { "alkene", "alkyne", "nitro", "azide", "benzyl ether", "aryl bromide" },
    recipe = "H2 (1-3 bar), 10 % Pd/C, aqueous AcOH or EtOH, rt",
    yield = { 85, 98 },
    cautions = { "hydrogen", "palladium on carbon" },
    source = "Bergmann, Zervas, Ber. Dtsch. Chem. Ges. 1932, 65, 1192; from memory",
    example { "C[C@H](N)C(=O)NCC(=O)O",
        from = { "C[C@H](NC(=O)OCc1ccccc1)C(=O)NCC(=O)OCc1ccccc1" } },
    refuse { "NCC(N)=O" }, -- an amide end
}

interconversion "isopropenyl-hydrogenation" {
    about = "Hydrogenation of a 1,1-disubstituted terminal alkene; syn; racemic without a chiral catalyst",
    rxno = "RXNO:0000339",
    target = "[C;X4;H3:1][C;X4;H1:2]([#6;c,$([CX3]=O):3])[#6:4]",
    from = "[C;H2:1]=[C;H0:2]([#6:3])[#6:4]",
    conditions = "h2-pd",
    recipe = "H2 (1-3 bar), Pd/C, EtOH, rt",
    yield = { 90, 99 },
    cautions = { "hydrogen", "palladium on carbon" },
    source = "Larock, Comprehensive Organic Transformations; from memory",
    example { "COC(=O)c1ccc(cc1)C(C)C", from = { "COC(=O)c1ccc(cc1)C(C)=C" } },
    example { "CC(C)c1ccccc1", from = { "CC(=C)c1ccccc1" } },
    refuse { "CC(C)(C)c1ccccc1" }, -- no H on the branched carbon
}

interconversion "diarylalkene-hydrogenation" {
    about = "Hydrogenation of a 1,1-diarylalkene; racemic",
    rxno = "RXNO:0000339",
    target = "[c:4][C;X4;H1:2]([c:5])-!@[C;X4;H2:1][#6;!$(C=[O,N]):3]",
    from = "[c:4][C;H0:2]([c:5])=[C;H1:1][#6:3]",
    conditions = "h2-pd",
    recipe = "H2 (1-3 bar), Pd/C or PtO2, EtOH or AcOH, rt",
    yield = { 80, 95 },
    cautions = { "hydrogen", "palladium on carbon" },
    source = "Kleemann and Engel, Pharmaceutical Substances; from memory",
    example { "CN(C)CCC(c1ccc(Cl)cc1)c1ccccn1", from = { "CN(C)CC=C(c1ccc(Cl)cc1)c1ccccn1" } },
    example { "CCC(c1ccccc1)c1ccccc1", from = { "CC=C(c1ccccc1)c1ccccc1" } },
    refuse { "c1ccc(Cc2ccccc2)cc1" }, -- no chain on the carbon
}

interconversion "cycloalkylidene-hydrogenation" {
    about = "Hydrogenation of a cycloalkylidene (after a Wittig reaction); from the less hindered face",
    rxno = "RXNO:0000339",
    target = "[#6:3][C;X4;H2:1]-!@[C;X4;H1;R:2]([C;X4;R:4])[C;X4;R:5]",
    from = "[#6:3][C;H1:1]=[C;H0:2]([C:4])[C:5]",
    when = function(m) return not m.molecule:has "[CX3]=[CX3]" end,
    conditions = "h2-pd",
    recipe = "H2 (1-3 bar), Pd/C, EtOH or EtOAc, rt",
    yield = { 90, 99 },
    cautions = { "hydrogen", "palladium on carbon" },
    source = "Larock, Comprehensive Organic Transformations; from memory",
    example { "CCOC(=O)CC1CCN(CC1)C(=O)OC(C)(C)C", from = { "CCOC(=O)C=C1CCN(CC1)C(=O)OC(C)(C)C" } },
    example { "CCOC(=O)CC1CCCCC1", from = { "CCOC(=O)C=C1CCCCC1" } },
    refuse { "CCC1(C)CCCCC1" }, -- no H on the ring carbon
}

interconversion "dehydroamino-acid-hydrogenation" {
    about = "Hydrogenation of an N-acyl dehydroamino acid; enantioselective with a chiral rhodium diphosphine; racemic over Pd/C",
    rxno = "RXNO:0000339",
    target = "[N;X3;H1:1]([C;X3:2]=[O:3])[C;X4;H1:4]([C;X4;H2:5][#6:6])[C;X3:7](=[O:8])[O:9]",
    from = "[N:1]([C:2]=[O:3])[C;H0:4](=[C;H1:5][#6:6])[C:7](=[O:8])[O:9]",
    conditions = "h2-pd",
    recipe = "H2 (1-5 bar), [Rh(cod)(diphosphine)]BF4, MeOH, rt; also: Pd/C",
    yield = { 88, 98 },
    cautions = { "hydrogen" },
    source = "Kürti and Czakó, Strategic Applications of Named Reactions in Organic Synthesis; from memory",
    example { "COC(=O)[C@H](Cc1ccc(F)cc1)NC(C)=O", from = { "COC(=O)C(=Cc1ccc(F)cc1)NC(C)=O" } },
    example { "CC(=O)NC(Cc1ccccc1)C(=O)O", from = { "CC(=O)NC(=Cc1ccccc1)C(=O)O" } },
    refuse { "COC(=O)C(C)NC(C)=O" }, -- no substituent on the β carbon
}

interconversion "cyclohexene-diels-alder-hydrogenation" {
    about = "Hydrogenation of the ring alkene of a Diels-Alder adduct; ring fusion keeps its cis geometry",
    rxno = "RXNO:0000339",
    target = "[C;X4;H2;r6:1]1[C;X4;H2;r6:2][C;X4:3][C;X4:4]([C;X3:7]=[O:8])[C;X4:5]([C;X3:9]=[O:10])[C;X4:6]1",
    from = "[C;H1:1]1=[C;H1:2][C:3][C:4]([C:7]=[O:8])[C:5]([C:9]=[O:10])[C:6]1",
    conditions = "h2-pd",
    recipe = "H2 (1-3 bar), Pd/C, EtOAc, rt",
    yield = { 90, 99 },
    cautions = { "hydrogen", "palladium on carbon" },
    source = "Larock, Comprehensive Organic Transformations; from memory",
    example { "O=C1NC(=O)C2CCCCC12", from = { "O=C1NC(=O)C2CC=CCC12" } },
    example { "O=C1OC(=O)C2CCCCC12", from = { "O=C1OC(=O)C2CC=CCC12" } },
    refuse { "C1CCCCC1" }, -- no trace of a dienophile
}

interconversion "tetrahydropyridine-hydrogenation" {
    about = "4-Arylpiperidine by hydrogenation of the tetrahydropyridine",
    rxno = "RXNO:0000339",
    target = "[c:1][C;X4;H1:2]1[C;X4;H2:3][C;X4;H2:4][N;X3:5][C;X4;H2:6][C;X4;H2:7]1",
    from = "[c:1][C;H0:2]1=[C;H1:3][C:4][N:5][C:6][C:7]1",
    conditions = "h2-pd",
    recipe = "H2 (1-3 bar), Pd/C, EtOH, rt; also: HCO2NH4",
    yield = { 88, 98 },
    cautions = { "hydrogen", "palladium on carbon" },
    source = "Larock, Comprehensive Organic Transformations; from memory",
    example { "CC(C)(C)OC(=O)N1CCC(CC1)c1ccc(N)c(OC)c1", from = { "CC(C)(C)OC(=O)N1CCC(=CC1)c1ccc(N)c(OC)c1" } },
    example { "C1CC(CCN1)c1ccccc1", from = { "C1NCC=C(C1)c1ccccc1" } },
    refuse { "CN1CCC(C)(CC1)c1ccccc1" }, -- quaternary carbon
}

interconversion "arene-hydrogenation" {
    about = "Hydrogenation of a monosubstituted benzene ring (aryl reduction to cycloalkyl); neighbouring stereocentres are kept",
    rxno = "RXNO:0000351",
    target = "[C;X4;H1;R1;$(C-C(=O)[O,N]),$(C-[NX3;H2]),$(C-[OX2H1]),$(C-[CX4]):1]1[C;X4;H2;R1:2][C;X4;H2;R1:3][C;X4;H2;R1:4][C;X4;H2;R1:5][C;X4;H2;R1:6]1",
    from = "[c;H0:1]1[c:2][c:3][c:4][c:5][c:6]1",
    conditions = "h2-pd",
    also_attacks = { "aldehyde", "ketone", "aryl chloride", "pyridine" },
    recipe = "H2 (3-10 bar), PtO2 or Rh/C, AcOH or EtOH, 25-60 °C",
    yield = { 80, 96 },
    cautions = { "hydrogen" },
    source = "March's Advanced Organic Chemistry; from memory",
    example { "N[C@@H](CC1CCCCC1)C(=O)O", from = { "N[C@@H](Cc1ccccc1)C(=O)O" } },
    example { "OC(=O)C1CCCCC1", from = { "OC(=O)c1ccccc1" } },
    refuse { "OC(=O)C1(C)CCCCC1" }, -- quaternary ring carbon
}

interconversion "arene-hydrogenation-para" {
    about = "Hydrogenation of a para-disubstituted benzene ring (aryl reduction to cycloalkyl); cis by preference; base or heat equilibrates to trans",
    rxno = "RXNO:0000351",
    target = "[C;X4;H1;R1;$(C-C(=O)[O,N]),$(C-[NX3;H2]),$(C-[OX2H1]):1]1[C;X4;H2;R1:2][C;X4;H2;R1:3][C;X4;H1;R1:4][C;X4;H2;R1:5][C;X4;H2;R1:6]1",
    from = "[c;H0:1]1[c:2][c:3][c;H0:4][c:5][c:6]1",
    conditions = "h2-pd",
    also_attacks = { "aldehyde", "ketone", "aryl chloride", "pyridine" },
    recipe = "H2 (5-100 bar), PtO2 or Rh/C or Ru/C, AcOH or aq. NaOH, 25-100 °C",
    yield = { 75, 95 },
    cautions = { "sodium hydroxide", "hydrogen" },
    source = "Kleemann and Engel, Pharmaceutical Substances; from memory",
    example { "NC[C@H]1CC[C@@H](CC1)C(=O)O", from = { "NCc1ccc(cc1)C(=O)O" } },
    example { "CC1CCC(CC1)C(=O)O", from = { "Cc1ccc(cc1)C(=O)O" } },
    refuse { "OC(=O)C1(C)CCCCC1" }, -- quaternary ring carbon
}

interconversion "pyridine-hydrogenation-3" {
    about = "3-Substituted piperidine by hydrogenation of a pyridine; racemic",
    rxno = "RXNO:0000352",
    target = "[N;X3;H1;R1:1]1[C;X4;H2;R1:2][C;X4;H1;R1:3]([#6:7])[C;X4;H2;R1:4][C;X4;H2;R1:5][C;X4;H2;R1:6]1",
    from = "[n;H0:1]1[c:2][c;H0:3]([#6:7])[c:4][c:5][c:6]1",
    conditions = "h2-pd",
    also_attacks = { "ketone" },
    recipe = "H2 (3-50 bar), PtO2, AcOH or HCl/MeOH, rt; also: Rh/C, Raney nickel",
    yield = { 80, 95 },
    cautions = { "hydrochloric acid", "hydrogen" },
    source = "March's Advanced Organic Chemistry; from memory",
    example { "CCOC(=O)C1CCCNC1", from = { "CCOC(=O)c1cccnc1" } },
    example { "NC(=O)C1CCCNC1", from = { "NC(=O)c1cccnc1" } },
    refuse { "CC1(C)CCCNC1" }, -- quaternary ring carbon
}

interconversion "pyridine-hydrogenation-4" {
    about = "4-Substituted piperidine by hydrogenation of a pyridine; benzene ring survives under mild conditions; aryl ketones are at risk",
    rxno = "RXNO:0000352",
    target = "[N;X3;H1;R1:1]1[C;X4;H2;R1:2][C;X4;H2;R1:3][C;X4;H1;R1:4]([#6:7])[C;X4;H2;R1:5][C;X4;H2;R1:6]1",
    from = "[n;H0:1]1[c:2][c:3][c;H0:4]([#6:7])[c:5][c:6]1",
    conditions = "h2-pd",
    also_attacks = { "other ketone" },
    recipe = "H2 (3-10 bar), PtO2, MeOH/HCl, rt; also: Rh/C",
    yield = { 70, 92 },
    cautions = { "hydrochloric acid", "hydrogen" },
    source = "Kleemann and Engel, Pharmaceutical Substances; from memory",
    example { "COc1cc2CC(CC3CCNCC3)C(=O)c2cc1OC", from = { "COc1cc2CC(Cc3ccncc3)C(=O)c2cc1OC" } },
    example { "OC(=O)C1CCNCC1", from = { "OC(=O)c1ccncc1" } },
    refuse { "CC1(C)CCNCC1" }, -- quaternary ring carbon
}

interconversion "quinoline-partial-hydrogenation" {
    about = "1,2,3,4-Tetrahydroquinoline from a quinoline; only the hetero ring is reduced",
    rxno = "RXNO:0000352",
    target = "[N;X3;H1;R1:1]1[C;X4;H1,H2:2][C;X4;H1,H2:3][C;X4;H1,H2:4][c:5]:[c:6]1",
    from = "[n;H0:1]1[c:2][c:3][c:4][c:5][c:6]1",
    conditions = "h2-pd",
    recipe = "H2 (3-50 bar), PtO2, MeOH; also: Raney nickel, NaBH3CN/BF3·OEt2, NiCl2/NaBH4",
    yield = { 80, 95 },
    cautions = { "hydrogen" },
    source = "Joule and Mills, Heterocyclic Chemistry; from memory",
    example { "COc1ccc2NCCCc2c1", from = { "COc1ccc2ncccc2c1" } },
    example { "C1CNc2ccccc2C1", from = { "c1ccc2ncccc2c1" } },
    refuse { "CC1(C)CCc2ccccc2N1" }, -- quaternary ring carbon
}

interconversion "indole-to-indoline" {
    about = "Reduction of an indole to the indoline; trans for 2,3-disubstituted",
    rxno = "RXNO:0000352",
    target = "[N;X3;H1;r5:1]1[C;X4;H1,H2;r5:2][C;X4;H1,H2;r5:3][c:4]:[c:5]1",
    from = "[nH:1]1[c:2][c:3][c:4][c:5]1",
    conditions = "reductive-amination",
    also_attacks = { "iminium" },
    recipe = "NaBH3CN, AcOH, 15-20 °C; also: BH3·pyridine, Et3SiH/CF3CO2H",
    yield = { 75, 95 },
    cautions = { "hydrogen cyanide", "sodium cyanoborohydride" },
    source = "Joule and Mills, Heterocyclic Chemistry; from memory",
    example { "Brc1ccc2NCCc2c1", from = { "Brc1ccc2[nH]ccc2c1" } },
    example { "C1Cc2ccccc2N1", from = { "c1ccc2[nH]ccc2c1" } },
    refuse { "CC1(C)CNc2ccccc12" }, -- quaternary C3
}

interconversion "furan-hydrogenation" {
    about = "Tetrahydrofuran by hydrogenation of a furan; racemic",
    rxno = "RXNO:0000352",
    target = "[O;X2;R1:1]1[C;X4;H1;R1:2]([#6:6])[C;X4;H2;R1:3][C;X4;H2;R1:4][C;X4;H2;R1:5]1",
    from = "[o:1]1[c;H0:2]([#6:6])[c:3][c:4][c:5]1",
    conditions = "h2-raney",
    also_attacks = { "benzyl ether", "benzyl ester", "Cbz amine" },
    recipe = "H2 (5-50 bar), Raney nickel or Pd/C or Rh/C, EtOH, 25-100 °C",
    yield = { 75, 92 },
    cautions = { "hydrogen", "nickel (Raney)", "palladium on carbon" },
    source = "Joule and Mills, Heterocyclic Chemistry; from memory",
    example { "NCC1CCCO1", from = { "NCc1ccco1" } },
    example { "OCC1CCCO1", from = { "OCc1ccco1" } },
    refuse { "CC1(C)CCCO1" }, -- quaternary ring carbon
}

interconversion "heteroaryl-dechlorination" {
    about = "Hydrogenolysis of a chloroazine; chlorine α or γ to ring nitrogen goes first",
    target = "[cH;$(c1cc[nX2]c2ccccc12),$(c1[nX2]c[nX2]c2ccccc12),$(c1[nX2]c2ccccc2cc1),$(c1[nX2]ccc2ccccc12),$(c1cc2ccccc2c[nX2]1),$(c1cc[nX2]c[nX2]1):1]",
    from = "[c;H0:1]Cl",
    conditions = "h2-pd",
    recipe = "H2 (1 bar), Pd/C, NaOAc or Et3N, EtOH; also: HCO2NH4, Zn/AcOH; bromide",
    yield = { 80, 95 },
    cautions = { "hydrogen", "palladium on carbon", "triethylamine" },
    source = "Joule and Mills, Heterocyclic Chemistry; from memory",
    example { "COc1cc2ccncc2cc1OC", from = { "COc1cc2cc(Cl)ncc2cc1OC" } },
    example { "c1ccc2cnccc2c1", from = { "Clc1nccc2ccccc12" } },
    refuse { "c1ccccc1" }, -- a benzene H: no activation
}

interconversion "nitro-reduction-oxindole" {
    about = "Oxindole by reductive cyclisation of a 2-nitrophenylacetate; lactam closes spontaneously on warming in acid",
    rxno = "RXNO:0000337",
    target = "[N;X3;H1;+0;r5:1]1[c:2]:[c:3][C;X4;r5:4][C;X3:5]1=[O;X1:6]",
    from = "[N+;H0:1](=O)([O-])-[c:2]:[c:3][C:4][C:5](=[O:6])OC",
    conditions = "fe-acid",
    also_attacks = { "aldehyde" },
    recipe = "Fe, AcOH, 100 °C; also: H2, Pd/C then TsOH; free acid, ethyl ester",
    yield = { 75, 95 },
    source = "Joule and Mills, Heterocyclic Chemistry; from memory",
    example { "O=C1Cc2ccc(F)cc2N1", from = { "COC(=O)Cc1ccc(F)cc1[N+](=O)[O-]" } },
    example { "O=C1Cc2ccccc2N1", from = { "COC(=O)Cc1ccccc1[N+](=O)[O-]" } },
    refuse { "CN1C(=O)Cc2ccccc12" }, -- an N-alkyl oxindole is not formed so
}

interconversion "nitro-reduction-dihydroquinolinone" {
    about = "3,4-Dihydro-2-quinolinone by reductive cyclisation; lactam closes spontaneously",
    rxno = "RXNO:0000337",
    target = "[N;X3;H1;+0;r6:1]1[c:2]:[c:3][C;X4;r6:4][C;X4;r6:7][C;X3:5]1=[O;X1:6]",
    from = "[N+;H0:1](=O)([O-])-[c:2]:[c:3][C:4][C:7][C:5](=[O:6])OCC",
    conditions = "h2-pd",
    recipe = "H2, Pd/C, EtOH, 60 °C; also: Fe/AcOH; from the 2-nitrocinnamate",
    yield = { 75, 92 },
    cautions = { "hydrogen", "palladium on carbon" },
    source = "Joule and Mills, Heterocyclic Chemistry; from memory",
    example { "COc1ccc2NC(=O)CCc2c1", from = { "CCOC(=O)CCc1cc(OC)ccc1[N+](=O)[O-]" } },
    example { "O=C1CCc2ccccc2N1", from = { "CCOC(=O)CCc1ccccc1[N+](=O)[O-]" } },
    refuse { "CN1C(=O)CCc2ccccc12" }, -- an N-alkyl lactam is not formed so
}

interconversion "nitro-reduction-benzoxazinone" {
    about = "2H-1,4-Benzoxazin-3-one by reductive cyclisation; lactam closes spontaneously",
    rxno = "RXNO:0000337",
    target = "[N;X3;H1;+0;r6:1]1[c:2]:[c:3][O;X2;r6:4][C;X4;r6:7][C;X3:5]1=[O;X1:6]",
    from = "[N+;H0:1](=O)([O-])-[c:2]:[c:3][O:4][C:7][C:5](=[O:6])OCC",
    conditions = "fe-acid",
    also_attacks = { "aldehyde" },
    recipe = "Fe, AcOH, 90 °C; also: H2 and Pd/C without aryl bromide, Na2S2O4",
    yield = { 75, 92 },
    source = "Joule and Mills, Heterocyclic Chemistry; from memory",
    example { "O=C1COc2ccc(Br)cc2N1", from = { "CCOC(=O)COc1ccc(Br)cc1[N+](=O)[O-]" } },
    example { "O=C1COc2ccccc2N1", from = { "CCOC(=O)COc1ccccc1[N+](=O)[O-]" } },
    refuse { "O=C1COCCN1" }, -- no arene to carry the nitro group
}

interconversion "diarylcarbinol-deoxygenation" {
    about = "Ionic reduction of a diarylcarbinol; needs a donor ring",
    target = "[c;!$(c~n);!$(c~c~n);!$(c~c~c~n);$(c1ccc(-[OX2,NX3,CX4])cc1),$(c1c(-[OX2,NX3,CX4])cccc1),$(c1ccc[s,o]1):1][C;X4;H2;!R:2][c;!$(c~n);!$(c~c~n);!$(c~c~c~n):3]",
    from = "[c:1][C;H1:2](O)[c:3]",
    conditions = "acid-dry-strong",
    also_attacks = { "ketone", "aldehyde", "alkene" },
    recipe = "Et3SiH, BF3·OEt2 or CF3CO2H, CH2Cl2, 0 °C; also: methyl ether",
    yield = { 80, 95 },
    cautions = { "boron trifluoride etherate", "trifluoroacetic acid" },
    source = "Carey and Sundberg, Advanced Organic Chemistry, Part B; from memory",
    example { "CCOc1ccc(Cc2cc(Br)ccc2Cl)cc1", from = { "CCOc1ccc(cc1)C(O)c1cc(Br)ccc1Cl" } },
    example { "COc1ccc(Cc2ccccc2)cc1", from = { "COc1ccc(cc1)C(O)c1ccccc1" } },
    refuse { "CCc1ccccc1" }, -- only one aryl group
    refuse { "c1ccc(Cc2ccncc2)cc1" }, -- no donor ring to steady the cation
}

interconversion "benzylic-alcohol-hydrogenolysis" {
    about = "Hydrogenolysis of a benzylic alcohol",
    target = "[c;$(c1ccc([OX2])cc1):1][C;X4;H2;!R;!$(C-[!#6]):2]-!@[C;X4;H2,H3:3]",
    from = "[c:1][C;H1:2](O)[C:3]",
    conditions = "h2-pd",
    also_attacks = { "other benzylic alcohol" },
    recipe = "H2 (3 bar), Pd/C, AcOH with HClO4 or H2SO4, 25-60 °C",
    yield = { 75, 95 },
    cautions = { "sulfuric acid", "hydrogen", "palladium on carbon" },
    source = "Larock, Comprehensive Organic Transformations; from memory",
    example { "COc1ccc(CCCN2CCOCC2)cc1", from = { "COc1ccc(cc1)C(O)CCN1CCOCC1" } },
    example { "COc1ccc(CCC)cc1", from = { "COc1ccc(cc1)C(O)CC" } },
    refuse { "CC(C)(C)c1ccccc1" }, -- benzylic carbon without two H
}

interconversion "mandelic-acid-deoxygenation" {
    about = "Arylacetic acid by reduction of a mandelic acid",
    target = "[c:1][C;X4;H2:2][C;X3:3](=[O:4])[O;X2;H1:5]",
    from = "[c:1][C;H1:2](O)[C:3](=[O:4])[O:5]",
    conditions = "acid-aq-strong",
    also_attacks = { "alkyl iodide", "aryl methyl ether", "nitro", "alkene" },
    recipe = "red P and HI (cat.), AcOH, reflux; also: SnCl2/HCl, H3PO2/NaI, H2 and Pd/C in acid",
    yield = { 70, 90 },
    cautions = { "hydriodic acid", "phosphorus" },
    source = "Vogel's Textbook of Practical Organic Chemistry; from memory",
    example { "OC(=O)Cc1ccc(O)cc1", from = { "OC(=O)C(O)c1ccc(O)cc1" } },
    example { "OC(=O)Cc1ccccc1", from = { "OC(=O)C(O)c1ccccc1" } },
    refuse { "OC(=O)CCc1ccccc1" }, -- carboxyl not on the benzylic carbon
}

interconversion "dihydronaphthalene-aromatisation" {
    about = "Naphthalene by dehydrogenation of a 1,2-dihydronaphthalene",
    target = "[cH:1]1:[cH:2]:[$(c-[#6]),$([cH]:c-[#6]):3]:[cH,$(c-[#6]):4]:[c;$(c12ccccc1cccc2):5]:[c;$(c12ccccc1cccc2):6]:1",
    from = "[C;H2:1]1-[C;H2:2]-[C:3]=[C:4]-[c:5]:[c:6]-1",
    conditions = "ddq",
    also_attacks = { "allylic alcohol", "benzylic alcohol", "electron-rich phenol" },
    recipe = "DDQ, toluene, 80 °C; also: Pd/C in p-cymene reflux, S at 200 °C",
    yield = { 75, 92 },
    cautions = { "2,3-dichloro-5,6-dicyanobenzoquinone" },
    source = "Carey and Sundberg, Advanced Organic Chemistry, Part B; from memory",
    example { "COc1ccc2c(ccc(-c3ccccc3)c2)c1", from = { "COc1ccc2C=C(CCc2c1)c1ccccc1" } },
    example { "c1ccc(cc1)-c1cccc2ccccc12", from = { "C1CC=C(c2ccccc2)c2ccccc12" } },
    refuse { "c1ccccc1" }, -- no benzo ring
}

interconversion "tetrahydrocarbazole-aromatisation" {
    about = "Carbazole by dehydrogenation of a tetrahydrocarbazole",
    target = "[c:1]1:[c:2]:[c:3]:[c:4]:[c;$(c1[nX3]c2ccccc2c1):5]:[c;$(c1c2ccccc2[nX3]c1):6]:1",
    from = "[C:1]1-[C:2]-[C:3]-[C:4]-[c:5]:[c:6]-1",
    conditions = "ddq",
    also_attacks = { "allylic alcohol", "benzylic alcohol" },
    recipe = "chloranil, xylene, reflux; also: DDQ, Pd/C at 250 °C",
    yield = { 60, 88 },
    cautions = { "chloranil" },
    source = "Joule and Mills, Heterocyclic Chemistry; from memory",
    example { "Clc1ccc2[nH]c3ccccc3c2c1", from = { "Clc1ccc2[nH]c3CCCCc3c2c1" } },
    example { "c1ccc2c(c1)[nH]c1ccccc12", from = { "C1CCc2c(C1)[nH]c1ccccc21" } },
    refuse { "c1ccc2[nH]ccc2c1" }, -- an indole has no fourth ring side to dehydrogenate
}

interconversion "dihydroisoquinoline-aromatisation" {
    about = "Isoquinoline by dehydrogenation of a 3,4-dihydroisoquinoline",
    target = "[n;X2:1]1:[cH:2]:[cH:3]:[c;$(c1ccccc1):4]:[c;$(c1ccccc1):5]:[c:6]:1",
    from = "[N:1]1[C;H2:2][C;H2:3][c:4]:[c:5][C:6]=1",
    conditions = "ddq",
    also_attacks = { "cyclohexene", "allylic alcohol", "benzyl ether" },
    recipe = "Pd/C, tetralin or decalin, 180-200 °C; also: MnO2, S",
    yield = { 60, 85 },
    cautions = { "palladium on carbon" },
    source = "Joule and Mills, Heterocyclic Chemistry; from memory",
    example { "COc1cc2ccnc(Cc3ccc(OC)c(OC)c3)c2cc1OC", from = { "COc1cc2CCN=C(Cc3ccc(OC)c(OC)c3)c2cc1OC" } },
    example { "Cc1nccc2ccccc12", from = { "CC1=NCCc2ccccc12" } },
    refuse { "c1ccc2ncccc2c1" }, -- a quinoline
}

interconversion "tetrahydro-beta-carboline-aromatisation" {
    about = "β-Carboline by dehydrogenation of a tetrahydro-β-carboline",
    target = "[n;X2:1]1:[cH:2]:[cH:3]:[c;$(c1c2ccccc2[nX3]c1):4]:[c;$(c1[nX3]c2ccccc2c1):5]:[c:6]:1",
    from = "[N;H1:1]1[C;H2:2][C;H2:3][c:4]:[c:5][C:6]1",
    conditions = "ddq",
    also_attacks = { "allylic alcohol", "benzylic alcohol" },
    recipe = "Pd/C, xylene, reflux; also: KMnO4 in THF, S, MnO2",
    yield = { 55, 85 },
    cautions = { "palladium on carbon" },
    source = "Joule and Mills, Heterocyclic Chemistry; from memory",
    example { "COc1ccc2c(c1)[nH]c1c(C)nccc12", from = { "COc1ccc2c(c1)[nH]c1C(C)NCCc12" } },
    example { "Cc1nccc2c1[nH]c1ccccc21", from = { "CC1NCCc2c1[nH]c1ccccc21" } },
    refuse { "Cc1nccc2ccccc12" }, -- an isoquinoline, no indole
}

interconversion "pyrazoline-oxidation" {
    about = "Pyrazole by oxidation of a 2-pyrazoline; places the aryl groups of a chalcone without isomers",
    target = "[n;X3;+0:1]1:[n;X2:2]:[c;R1:3]:[cH;R1:4]:[c;R1:5]:1",
    from = "[N:1]1[N:2]=[C:3][C;H2:4][C;H1:5]1",
    conditions = "ddq",
    also_attacks = { "allylic alcohol", "benzylic alcohol" },
    recipe = "DDQ, toluene, rt; also: MnO2, I2, air",
    yield = { 75, 95 },
    cautions = { "2,3-dichloro-5,6-dicyanobenzoquinone" },
    source = "Joule and Mills, Heterocyclic Chemistry; from memory",
    example { "Clc1ccc(cc1)-c1cc(-c2ccccc2)n(n1)-c1ccccc1", from = { "Clc1ccc(cc1)C1=NN(C(C1)c1ccccc1)c1ccccc1" } },
    example { "c1ccc(cc1)-c1cc(-c2ccccc2)[nH]n1", from = { "C1C(NN=C1c1ccccc1)c1ccccc1" } },
    refuse { "c1c[nH]cn1" }, -- an imidazole
}

interconversion "phenol-hydrogenation" {
    about = "Cyclohexanol by hydrogenation of a phenol",
    target = "[OX2H:1]-[CX4;H1;R1:2]1[CX4;H1,H2;R1:3][CX4;H1,H2;R1:4][CX4;H1,H2;R1:5][CX4;H1,H2;R1:6][CX4;H1,H2;R1:7]1",
    from = "[O:1]-[c:2]1[c:3][c:4][c:5][c:6][c:7]1",
    conditions = "h2-raney",
    also_attacks = { "alkene", "alkyne", "nitro", "ketone", "aryl halide", "benzyl ether" },
    recipe = "H2 (20-100 bar), Raney nickel or Rh/C, 80-180 °C; mixture of stereoisomers",
    yield = { 75, 95 },
    cautions = { "hydrogen", "nickel (Raney)" },
    source = "Vogel's Textbook of Practical Organic Chemistry; from memory",
    example { "CC1CCC(C(C)C)C(O)C1", from = { "Cc1ccc(C(C)C)c(O)c1" } },
    example { "OC1CCC(CC1)C(C)(C)C", from = { "Oc1ccc(cc1)C(C)(C)C" } },
    refuse { "CC1(C)CCCCC1O" }, -- a quaternary ring carbon
}

interconversion "isopropenyl-to-isopropyl" {
    about = "Hydrogenation of an isopropenyl group on a ring",
    target = "[CX4;H3:1][CX4;H1:2]([CH3:4])[CX4;R:3]",
    from = "[C:1]=[C:2]([C:4])[C:3]",
    conditions = "h2-pd",
    also_attacks = { "other alkene", "alkyne", "nitro", "azide" },
    recipe = "H2 (1-3 bar), PtO2 or Pd/C, EtOH, rt",
    yield = { 90, 99 },
    cautions = { "hydrogen" },
    source = "common practice, no source",
    example { "CC1CCC(C(C)C)C(O)C1", from = { "CC1CCC(C(C)=C)C(O)C1" } },
    example { "CC(C)C1CCCCC1", from = { "CC(=C)C1CCCCC1" } },
    refuse { "CCC(C)(C)C" }, -- no ring
}

interconversion "phthalide-reduction" {
    about = "2-(2-Arylethyl)benzoic acid by reduction of a benzylidenephthalide",
    target = "[OX2H:1][CX3:2](=[OX1:3])-[c:4]:[c:5]-[CX4;H2;!R:6]-[CX4;H2;!R:7]-[c:8]",
    from = "[O:1]1[C:2](=[O:3])-[c:4]:[c:5]-[C:6]1=[C:7]-[c:8]",
    conditions = "h2-pd",
    also_attacks = { "alkene", "nitro", "aryl bromide", "benzyl ether" },
    recipe = "red P, HI, reflux; also: H2, Pd/C, AcOH; Zn, NH3",
    yield = { 75, 92 },
    cautions = { "hydriodic acid" },
    source = "Kleemann and Engel, Pharmaceutical Substances; from memory",
    example { "OC(=O)c1ccccc1CCc1ccccc1", from = { "O=C1OC(=Cc2ccccc2)c2ccccc12" } },
    refuse { "OC(=O)c1ccccc1CC" }, -- no aryl group at the end
}

interconversion "ketone-and-ester-to-diol" {
    about = "Ketone and benzoic ester of one molecule to the diol in one operation",
    target = "([CX4;H1:1]([OX2H:2])([CX4:3])[c:4].[c:5][CX4;H2:6][OX2H:7])",
    from = "([C:1](=[O:2])([C:3])[c:4].[c:5][C:6](=[O:7])OC)",
    conditions = "lialh4",
    also_attacks = { "other ester", "nitrile", "amide", "epoxide", "nitro", "aldehyde" },
    recipe = "LiAlH4, THF, reflux; also: BH3·SMe2; NaBH4 with Lewis acid",
    yield = { 70, 92 },
    cautions = { "lithium aluminium hydride" },
    source = "Kleemann and Engel, Pharmaceutical Substances; from memory",
    example { "CC(C)(C)N(Cc1ccccc1)CC(O)c1ccc(O)c(CO)c1",
        from = { "COC(=O)c1cc(C(=O)CN(Cc2ccccc2)C(C)(C)C)ccc1O" } },
    example { "CC(O)c1ccc(CO)cc1", from = { "COC(=O)c1ccc(cc1)C(C)=O" } },
    refuse { "OCc1ccccc1" }, -- one group only
}

interconversion "dehydration-diaryl" {
    about = "1,1-Diarylalkene by dehydration of a tertiary diarylcarbinol",
    target = "[CX3:1]([c:2])([c:3])=[CX3:4]-[#6:5]",
    from = "[C:1](O)([c:2])([c:3])[C:4]-[#6:5]",
    conditions = "acid-aq-strong",
    also_attacks = { "other tertiary alcohol", "acetal", "Boc carbamate", "tert-butyl ester" },
    recipe = "HCl, EtOH or AcOH, reflux; also: H2SO4; TsOH, toluene; E and Z",
    yield = { 75, 96 },
    cautions = { "hydrochloric acid" },
    source = "Kleemann and Engel, Pharmaceutical Substances; from memory",
    example { "CN(C)CCC=C1c2ccccc2CCc2ccccc12", from = { "CN(C)CCCC1(O)c2ccccc2CCc2ccccc12" } },
    example { "CC=C(c1ccccc1)c1ccccc1", from = { "CCC(O)(c1ccccc1)c1ccccc1" } },
    refuse { "CC=C(C)C" }, -- no aryl groups
}

interconversion "terminal-alkyne-semihydrogenation" {
    about = "Terminal alkene by partial hydrogenation of an alkyne beside a carbinol",
    target = "[CX3;H2:1]=[CX3;H1:2]-[CX4;$(C[OX2H]):3]",
    from = "[C:1]#[C:2]-[C:3]",
    conditions = "h2-lindlar",
    also_attacks = { "other alkyne", "azide", "nitro" },
    recipe = "H2 (1 bar), Lindlar catalyst, quinoline, hexane, rt",
    yield = { 85, 98 },
    cautions = { "hydrogen" },
    source = "common practice, no source",
    example { "CC(C)=CCCC(C)(O)C=C", from = { "CC(C)=CCCC(C)(O)C#C" } },
    example { "CC(C)(O)C=C", from = { "CC(C)(O)C#C" } },
    refuse { "C=CCCC" }, -- no hydroxyl group beside it
}
