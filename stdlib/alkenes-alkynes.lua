-- Alkenes and alkynes, and the loss of functional groups.
-- Yields are typical ranges and sources stand from memory unless a source says otherwise.

pack {
    name = "alkenes-alkynes",
    version = "0.1.0",
    licence = "CC0-1.0",
    about = "Alkenes and alkynes, and the loss of functional groups",
    needs = { "synthons" },
}

interconversion "lindlar-reduction" {
    about = "Lindlar hydrogenation of an alkyne; Z (syn addition of H2); alkane is the rival",
    target = "[#6:3]/[C;X3;H1:1]=;!@[C;X3;H1:2]\\[#6:4]",
    from = "[#6:3][C;X2;H0:1]#[C;X2;H0:2][#6:4]",
    conditions = "h2-lindlar",
    also_attacks = { "alkyne", "azide", "nitro", "thiol", "thioether" },
    recipe = "H2 (1 atm), Pd/CaCO3-Pb(OAc)2, quinoline, EtOAc or MeOH, rt; also: P-2 nickel",
    yield = { 80, 96 },
    cautions = { "hydrogen", "lead salts" },
    source = "Clayden, Greeves, Warren, Organic Chemistry; from memory",
    example { "COC(=O)CC/C=C\\CCO", from = { "COC(=O)CCC#CCCO" } },
    refuse { "CC/C=C/CCO" }, -- E alkene is not formed by syn hydrogenation
}

interconversion "dissolving-metal-alkyne" {
    about = "Dissolving-metal reduction of an alkyne; E (anti)",
    target = "[C;X4:3]/[C;X3;H1:1]=;!@[C;X3;H1:2]/[C;X4:4]",
    from = "[C;X4:3][C;X2;H0:1]#[C;X2;H0:2][C;X4:4]",
    conditions = "birch",
    also_attacks = { "alkyne", "alkyl halide", "aryl halide", "benzyl ether", "aldehyde", "ketone", "ester",
        "epoxide", "nitro", "azide", "Cbz amine", "thioether" },
    recipe = "Na, NH3 (l), tBuOH, -78 to -33 °C; also: Li, EtNH2",
    yield = { 75, 92 },
    cautions = { "sodium", "ammonia" },
    source = "Clayden, Greeves, Warren, Organic Chemistry; from memory",
    example { "CCCC/C=C/CCCO", from = { "CCCCC#CCCCO" } },
    refuse { "CC/C=C\\CCO" }, -- Z alkene comes from Lindlar hydrogenation
}

interconversion "alkene-hydrogenation" {
    about = "Catalytic hydrogenation (alkene reduction to alkane); syn addition; conjugated and less substituted alkenes first; ester survives",
    rxno = "RXNO:0000339",
    target = "[c:1][C;X4;H2:2][C;X4;H2:3][#6:4]",
    from = "[c:1]/[C;X3;H1:2]=[C;X3;H1:3]/[#6:4]",
    conditions = "h2-pd",
    also_attacks = { "alkene", "alkyne", "nitro", "azide", "imine", "aryl halide", "benzyl ether",
        "benzyl ester", "Cbz amine", "thiol", "thioether" },
    recipe = "H2 (1-3 atm), Pd/C, EtOH or EtOAc, rt; also: PtO2, Raney Ni, (PPh3)3RhCl",
    yield = { 90, 99 },
    cautions = { "hydrogen" },
    source = "Clayden, Greeves, Warren, Organic Chemistry; from memory",
    example { "CCOC(=O)CCc1ccc(O)c(OC)c1", from = { "CCOC(=O)/C=C/c1ccc(O)c(OC)c1" } },
    refuse { "CC(C)(c1ccccc1)C(C)(C)C" }, -- no H on the two carbons
}

interconversion "dehydration-zaitsev" {
    about = "Acid dehydration of a tertiary alcohol; Zaitsev: the more substituted, conjugated alkene",
    target = "[#6:3][C;X3;H0:1]([C;X4:4])=[C;X3;H1:2][C;X4:5]",
    from = "[#6:3][C;X4;H0:1]([C;X4:4])([O;X2;H1])[C;X4;H2:2][C;X4:5]",
    conditions = "acid-aq-strong",
    also_attacks = { "free alcohol", "acetal", "silyl ether", "tert-butyl ester", "Boc amine", "epoxide",
        "trityl ether" },
    recipe = "TsOH, toluene, Dean-Stark; also: H3PO4; HCl (conc), reflux; SOCl2 or POCl3, pyridine",
    yield = { 70, 92 },
    source = "Clayden, Greeves, Warren, Organic Chemistry; from memory",
    example { "Clc1ccc(cc1)C1=CCNCC1", from = { "OC1(CCNCC1)c1ccc(Cl)cc1" } },
    refuse { "C=C1CCCCC1" }, -- the less substituted (exocyclic) alkene is not the Zaitsev product
}

interconversion "e2-terminal-alkene" {
    about = "E2 elimination of a primary halide with a bulky base; terminal alkene; ether is the rival with small alkoxides",
    target = "[C;X4:1][C;X3;H1:2]=[C;X3;H2:3]",
    from = "[C;X4:1][C;X4;H2:2][C;X4;H2:3][Br;X1]",
    conditions = "base-hindered",
    also_attacks = { "alkyl halide", "acyl halide", "ester", "aldehyde", "ketone", "terminal alkyne",
        "free alcohol", "phenol" },
    recipe = "KOtBu, THF or DMSO, 0 °C to rt; also: DBU, heat (I); OTs",
    yield = { 70, 90 },
    cautions = { "potassium tert-butoxide" },
    source = "Clayden, Greeves, Warren, Organic Chemistry; from memory",
    example { "C=CCCCO[Si](C)(C)C(C)(C)C", from = { "BrCCCCCO[Si](C)(C)C(C)(C)C" } },
    refuse { "CC=CC" }, -- internal alkene is not formed from a primary halide
}

interconversion "e2-zaitsev" {
    about = "E2 elimination of a tertiary halide; Zaitsev; anti-periplanar H and X",
    target = "[C;X3;H0:1]([C;X4:3])([C;X4:4])=[C;X3;H1:2][C;X4:5]",
    from = "[C;X4;H0:1]([C;X4:3])([C;X4:4])([Br;X1])[C;X4;H2:2][C;X4:5]",
    conditions = "alkoxide",
    also_attacks = { "alkyl halide", "acyl halide", "ester", "aldehyde", "ketone", "epoxide" },
    recipe = "NaOEt or KOH, EtOH, reflux; also: DBU; Cl, I",
    yield = { 65, 88 },
    cautions = { "potassium hydroxide" },
    source = "Clayden, Greeves, Warren, Organic Chemistry; from memory",
    example { "CC1=CCCCC1", from = { "CC1(Br)CCCCC1" } },
    refuse { "CCC(=C)CC" }, -- bulky base would be needed for the less substituted alkene
}

interconversion "beta-keto-acid-decarboxylation" {
    about = "Hydrolysis and decarboxylation of a beta-keto ester; ketone on the CH2",
    target = "[C;X4;H2,H3;!$(C[#7,#8,#16]):5][C;X4;H2:1][C;X3:2](=[O;X1:3])[#6;$([C;H3]),$(c):4]",
    from = "[C;X4:5][C;X4;H1:1]([C;X3](=O)[O;X2][C;H2][C;H3])[C;X3:2](=[O;X1:3])[#6:4]",
    conditions = "acid-aq-strong",
    also_attacks = { "ester", "acetal", "tert-butyl ester", "Boc amine", "epoxide", "nitrile" },
    recipe = "HCl (aq), reflux; also: NaOH then acid, heat; methyl or tert-butyl (TFA) ester",
    yield = { 75, 95 },
    cautions = { "hydrochloric acid" },
    source = "Clayden, Greeves, Warren, Organic Chemistry; from memory",
    example { "CC(=O)CCc1ccc(Cl)cc1", from = { "CCOC(=O)C(Cc1ccc(Cl)cc1)C(C)=O" } },
    refuse { "CC(=O)C(C)(C)C" }, -- alpha carbon carries no H to replace the ester group
}

interconversion "krapcho-methyl-malonate" {
    about = "Krapcho decarboxylation; methyl esters; neutral, acetals survive",
    rxno = "RXNO:0000507",
    target = "[C;X4;H2,H3;!$(C[#7,#8,#16]):5][C;X4;H2:1][C;X3:2](=[O;X1:3])[O;X2:4][C;H3:6]",
    from = "[C;X4:5][C;X4;H1:1]([C;X3](=O)[O;X2][C;H3])[C;X3:2](=[O;X1:3])[O;X2:4][C;H3:6]",
    conditions = "heat-200",
    also_attacks = { "alkyl halide", "acyl halide", "epoxide" },
    recipe = "NaCl or LiCl, H2O, DMSO, 150-180 °C",
    yield = { 65, 90 },
    source = "Kürti and Czakó, Strategic Applications of Named Reactions in Organic Synthesis; from memory",
    example { "COC(=O)CCC=C(C)C", from = { "COC(=O)C(CC=C(C)C)C(=O)OC" } },
    refuse { "COC(=O)C(C)(C)C" }, -- alpha carbon carries no H to replace the ester group
}

interconversion "dehydration-secondary-ring" {
    about = "Acid dehydration of a cycloalkanol without branches beside the alcohol",
    target = "[CX3;H1;R;r5,r6,r7:1]=;@[CX3;H1;R:2]([CX4;H2:3])",
    from = "[CX4;H1:1]([OX2H])[CX4;H2:2][C:3]",
    when = function(m) return m.atom[1].symmetry == m.atom[2].symmetry end,
    conditions = "acid-aq-strong",
    also_attacks = { "other alcohol", "acetal", "tert-butyl ester" },
    recipe = "conc. H2SO4 or H3PO4, 130-170 °C, the alkene distilled off",
    yield = { 75, 90 },
    cautions = { "sulfuric acid" },
    source = "Coleman, Johnstone, Org. Synth. Coll. Vol. 1, 183; from memory",
    example { "C1=CCCCC1", from = { "OC1CCCCC1" } },
    refuse { "CC1=CCCCC1" }, -- gives the trisubstituted alkene from a tertiary alcohol, another rule
}

interconversion "sulfolene-extrusion" {
    about = "Cheletropic extrusion of sulfur dioxide from a 3-sulfolene",
    target = "[CX3;H1,H2;!R:1]=[CX3;!R:2]-[CX3;!R:3]=[CX3;H1,H2;!R:4]",
    from = "[C:1]1[C:2]=[C:3][C:4]S1(=O)=O",
    conditions = "heat-200",
    recipe = "110-140 °C, neat or in xylene; the diene is distilled off or trapped",
    yield = { 80, 95 },
    cautions = { "sulfur dioxide", "buta-1,3-diene" },
    source = "Cope, Herrick, Org. Synth. Coll. Vol. 4, 890, discusses the diene; common practice; from memory",
    example { "C=CC=C", from = { "O=S1(=O)CC=CC1" } },
    refuse { "C1=CC=CCC1" }, -- a cyclic diene would come from a bridged sulfone
}
