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
