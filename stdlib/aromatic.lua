-- Substitution on arenes: electrophilic, nucleophilic, through diazonium salts; side chains.
-- Yields are typical ranges and sources stand from memory unless a source says otherwise.

pack {
    name = "aromatic",
    version = "0.1.0",
    licence = "CC0-1.0",
    about = "Substitution on arenes: electrophilic, nucleophilic, through diazonium salts; side chains",
    needs = { "synthons" },
}

-- Groups that direct ortho and para: donors, alkyl, halogen.
local GIVE = "[OX2,$([NX3;+0]),$([CX4;!$(C(F)(F)F)]),F,Cl,Br,I]"

-- Strong donors.
local STRONG = "[OX2,$([NX3;+0])]"

-- Acceptors, which direct meta.
local PULL = "[$([N+](=O)[O-]),$([CX3]=O),$(C#N),$(C(F)(F)F),$(S(=O)=O)]"

-- Acceptors that activate ortho and para positions for SNAr.
local ACTIVATE = "[$([N+](=O)[O-]),$([CX3]=O),$(C#N),$(S(=O)=O)]"

interconversion "nitration-directed" {
    about = "Nitration, ortho/para to a donor; para over ortho with bulky donors",
    target = "[c;$(c:c-" .. GIVE .. "),$(c1:c:c:c(-" .. GIVE .. "):c:c:1);!$(c1:c:c(-" .. STRONG ..
        "):c:c:c:1):1]-[NX3+:2](=[OX1:3])-[O-:4]",
    from = "[cH:1].O[N+:2](=[O:3])[O-:4]",
    conditions = "nitration",
    also_attacks = { "phenol", "primary amine", "secondary amine", "aldehyde", "alkene", "sulfide",
        "other electron-rich arene" },
    recipe = "HNO3, H2SO4 or Ac2O or AcOH, 0-25 °C",
    yield = { 60, 90 },
    cautions = { "nitric acid", "sulfuric acid" },
    source = "Vogel's Textbook of Practical Organic Chemistry; from memory",
    example { "CC(=O)Nc1ccc([N+](=O)[O-])cc1F", from = { "CC(=O)Nc1ccccc1F", "O[N+](=O)[O-]" } },
    refuse { "CC(=O)Nc1cccc([N+](=O)[O-])c1" }, -- meta to a donor
}

interconversion "nitration-meta" {
    about = "Nitration, meta to an acceptor; meta to an acceptor",
    target = "[c;$(c1:c:c(-" .. PULL .. "):c:c:c:1);!$(c:c-" .. GIVE .. ");!$(c1:c:c:c(-" .. GIVE ..
        "):c:c:1):1]-[NX3+:2](=[OX1:3])-[O-:4]",
    from = "[cH:1].O[N+:2](=[O:3])[O-:4]",
    conditions = "nitration",
    also_attacks = { "phenol", "primary amine", "secondary amine", "aldehyde", "alkene", "sulfide",
        "other electron-rich arene" },
    recipe = "HNO3, H2SO4, 0-60 °C",
    yield = { 70, 90 },
    cautions = { "nitric acid", "sulfuric acid" },
    source = "Vogel's Textbook of Practical Organic Chemistry; from memory",
    example { "COC(=O)c1cccc([N+](=O)[O-])c1", from = { "COC(=O)c1ccccc1", "O[N+](=O)[O-]" } },
    refuse { "COC(=O)c1ccc([N+](=O)[O-])cc1" }, -- para to an acceptor
}

interconversion "bromination-directed" {
    about = "Bromination of an arene, ortho/para to a donor; para over ortho",
    target = "[c;$(c:c-" .. GIVE .. "),$(c1:c:c:c(-" .. GIVE .. "):c:c:1):1]-Br",
    from = "[cH:1]",
    conditions = "br2",
    also_attacks = { "alkene", "phenol", "primary amine", "enolisable ketone", "other electron-rich arene" },
    recipe = "Br2, AcOH or FeBr3; NBS, MeCN (activated arenes), 0-25 °C",
    yield = { 70, 95 },
    cautions = { "bromine" },
    source = "Vogel's Textbook of Practical Organic Chemistry; from memory",
    example { "COc1ccc(Br)cc1C=O", from = { "COc1ccccc1C=O" } },
    refuse { "COc1cccc(Br)c1" }, -- meta to a donor
}

interconversion "bromination-meta" {
    about = "Bromination of a deactivated arene; meta to an acceptor",
    target = "[c;$(c1:c:c(-" .. PULL .. "):c:c:c:1);!$(c:c-" .. GIVE .. ");!$(c1:c:c:c(-" .. GIVE ..
        "):c:c:1):1]-Br",
    from = "[cH:1]",
    conditions = "br2",
    also_attacks = { "alkene", "phenol", "primary amine", "other electron-rich arene" },
    recipe = "Br2, Fe, 120-140 °C; or NBS, H2SO4; DBDMH, H2SO4",
    yield = { 60, 85 },
    cautions = { "bromine" },
    source = "Vogel's Textbook of Practical Organic Chemistry; from memory",
    example { "O=[N+]([O-])c1cccc(Br)c1", from = { "O=[N+]([O-])c1ccccc1" } },
    refuse { "O=[N+]([O-])c1ccc(Br)cc1" }, -- para to an acceptor
}

interconversion "chlorination-directed" {
    about = "Chlorination of an arene, ortho/para to a donor; para, then ortho",
    target = "[c;$(c:c-" .. STRONG .. "),$(c1:c:c:c(-" .. STRONG .. "):c:c:1):1]-Cl",
    from = "[cH:1]",
    conditions = "br2",
    also_attacks = { "alkene", "phenol", "primary amine", "sulfide", "other electron-rich arene" },
    recipe = "SO2Cl2, CH2Cl2 or AcOH; NCS, MeCN; Cl2",
    yield = { 60, 90 },
    cautions = { "sulfuryl chloride", "chlorine" },
    source = "March's Advanced Organic Chemistry; from memory",
    example { "CCOC(=O)c1ccc(OC)c(Cl)c1", from = { "CCOC(=O)c1ccc(OC)cc1" } },
    refuse { "CC(=O)Nc1cccc(Cl)c1" }, -- meta to a donor
}

interconversion "iodination-directed" {
    about = "Iodination of an electron-rich arene; para to O or N donors",
    target = "[c;$(c:c-" .. STRONG .. "),$(c1:c:c:c(-" .. STRONG .. "):c:c:1):1]-I",
    from = "[cH:1]",
    conditions = "br2",
    also_attacks = { "alkene", "phenol", "thiol", "other electron-rich arene" },
    recipe = "I2, AgOAc or HIO3; NIS, TFA; ICl, AcOH",
    yield = { 65, 90 },
    cautions = { "iodine monochloride" },
    source = "Vogel's Textbook of Practical Organic Chemistry; from memory",
    example { "COc1ccc(I)cc1C(=O)OC", from = { "COC(=O)c1ccccc1OC" } },
    refuse { "COc1cccc(I)c1" }, -- meta to the donor
}

interconversion "sulfonation" {
    about = "Sulfonation of an arene; para (thermodynamic), reversible",
    target = "[c;$(c:c-" .. GIVE .. "),$(c1:c:c:c(-" .. GIVE ..
        "):c:c:1),$(c1(-*):[cH]:[cH]:[cH]:[cH]:[cH]:1):1]-[SX4:2](=[OX1:3])(=[OX1:4])-[OX2H1:5]",
    from = "[cH:1].[S:2](=[O:3])(=[O:4])=[O:5]",
    conditions = "so3",
    also_attacks = { "free alcohol", "alkene", "acid-labile acetal", "primary amine" },
    recipe = "H2SO4 or oleum, 25-100 °C",
    yield = { 60, 90 },
    cautions = { "oleum", "sulfuric acid" },
    source = "Vogel's Textbook of Practical Organic Chemistry; from memory",
    example { "Cc1ccc(S(=O)(=O)O)c(C)c1", from = { "Cc1cccc(C)c1", "O=S(=O)=O" } },
    refuse { "COc1cccc(S(=O)(=O)O)c1" }, -- meta to the donor
}

interconversion "chlorosulfonation" {
    about = "Chlorosulfonation of an arene; para to the donor",
    target = "[c;$(c:c-" .. GIVE .. "),$(c1:c:c:c(-" .. GIVE ..
        "):c:c:1),$(c1(-*):[cH]:[cH]:[cH]:[cH]:[cH]:1):1]-[SX4:2](=[OX1:3])(=[OX1:4])-Cl",
    from = "[cH:1].O[S:2](=[O:3])(=[O:4])Cl",
    conditions = "so3",
    also_attacks = { "free alcohol", "primary amine", "alkene", "acid-labile acetal", "ester" },
    recipe = "ClSO3H (excess), 0-80 °C",
    yield = { 65, 85 },
    cautions = { "chlorosulfonic acid" },
    source = "Vogel's Textbook of Practical Organic Chemistry; from memory",
    example { "CC(=O)Nc1ccc(S(=O)(=O)Cl)cc1", from = { "CC(=O)Nc1ccccc1", "O=S(=O)(O)Cl" } },
    refuse { "O=[N+]([O-])c1ccc(S(=O)(=O)Cl)cc1" }, -- ring too electron-poor, wrong position
}

disconnection "fc-alkylation-tertiary" {
    about = "Friedel-Crafts alkylation by a tertiary carbon; para; polyalkylation is the rival",
    rxno = "RXNO:0000046",
    target = "[c;$(c:c-" .. GIVE .. "),$(c1:c:c:c(-" .. GIVE ..
        "):c:c:1),$(c1(-*):[cH]:[cH]:[cH]:[cH]:[cH]:1);!$(c:c-" .. PULL .. ");!$(c:c:c-" .. PULL ..
        ");!$(c:c:c:c-" .. PULL .. "):1]-!@[CX4;!R;$(C(c)([CX4])([CX4])[CX4]):2]",
    cut = { 2, 1 },
    acceptor = { 2, "carbocation" },
    donor = { 1, "arene" },
    conditions = "lewis-acid",
    also_attacks = { "free alcohol", "primary amine", "alkene", "other electron-rich arene",
        "acid-labile acetal" },
    recipe = "AlCl3 or FeCl3, CH2Cl2, 0 °C; also: alcohol or alkene with H2SO4",
    yield = { 55, 85 },
    cautions = { "aluminium chloride" },
    source = "Clayden, Greeves, Warren, Organic Chemistry; from memory",
    example { "COc1ccc(C(C)(C)C)cc1", from = { "COc1ccccc1", "CC(C)(C)Cl" } },
    refuse { "CCCCc1ccccc1" }, -- a primary cation rearranges
}

disconnection "fc-benzylation" {
    about = "Friedel-Crafts benzylation; para over ortho",
    rxno = "RXNO:0000046",
    target = "[c;$(c:c-" .. GIVE .. "),$(c1:c:c:c(-" .. GIVE ..
        "):c:c:1),$(c1(-*):[cH]:[cH]:[cH]:[cH]:[cH]:1);!$(c:c-" .. PULL .. ");!$(c:c:c-" .. PULL ..
        ");!$(c:c:c:c-" .. PULL .. "):1]-!@[CX4;H2:2]-[c:3]",
    cut = { 2, 1 },
    acceptor = { 2, "carbocation" },
    donor = { 1, "arene" },
    conditions = "lewis-acid",
    also_attacks = { "free alcohol", "primary amine", "alkene", "other electron-rich arene" },
    recipe = "AlCl3, ZnCl2 or FeCl3 cat., 0-40 °C; also: Br, alcohol with acid",
    yield = { 50, 80 },
    cautions = { "aluminium chloride" },
    source = "Vogel's Textbook of Practical Organic Chemistry; from memory",
    example { "COc1ccc(Cc2ccc(Cl)cc2)cc1", from = { "COc1ccccc1", "ClCc1ccc(Cl)cc1" } },
    refuse { "O=[N+]([O-])c1cccc(Cc2cccc([N+](=O)[O-])c2)c1" }, -- both rings carry a nitro group: neither can be attacked
}

disconnection "fc-acylation" {
    about = "Friedel-Crafts acylation; para; one acyl group only",
    rxno = "RXNO:0000045",
    target = "[c;$(c1:c:c:c(-" .. GIVE .. "):c:c:1),$(c1(-*):[cH]:[cH]:[cH]:[cH]:[cH]:1);!$(c1:c:c(-" ..
        PULL .. "):c:c:c:1);!$(c1:c(-" .. PULL .. "):c:c:c:c:1);!$(c1:c:c:c(-" .. PULL ..
        "):c:c:1);!$(c1:c:c:n:c:c:1);!$(c:n);!$(c:c:n):1]-!@[CX3;!R:2](=[OX1:3])-[#6;!$([#6]=O):4]",
    cut = { 2, 1 },
    acceptor = { 2, "acyl" },
    donor = { 1, "arene" },
    conditions = "lewis-acid",
    also_attacks = { "free alcohol", "primary amine", "alkene", "other electron-rich arene",
        "acid-labile acetal" },
    recipe = "AlCl3 (1.1 equiv.), CH2Cl2 or PhNO2, 0-25 °C; also: anhydride",
    yield = { 70, 95 },
    cautions = { "aluminium chloride" },
    source = "Clayden, Greeves, Warren, Organic Chemistry; from memory",
    example { "CC(=O)c1ccc(CC(C)C)cc1", from = { "CC(C)Cc1ccccc1", "CC(=O)Cl" } },
    refuse { "CC(=O)c1cccc([N+](=O)[O-])c1" }, -- nitrobenzene is a solvent for the reaction, not a substrate
}

disconnection "vilsmeier" {
    about = "Vilsmeier-Haack formylation; C3 of indole, C2 of pyrrole and thiophene, para to NR2",
    rxno = "RXNO:0000055",
    target = "[c;$(c1:c:c:c(-[NX3;H0;+0]):c:c:1),$([c;R1]1:[c;R1]:[nX3]:c:c1),$([c;R1]1:[nX3,s]:[c;R1]:[c;R1]:[c;R1]1):1]-[CX3;H1:2]=[OX1:3]",
    cut = { 2, 1 },
    acceptor = { 2, "formyl" },
    donor = { 1, "arene" },
    conditions = "acylation",
    also_attacks = { "free alcohol", "free acid", "primary amine", "enolisable ketone", "primary amide" },
    recipe = "POCl3, DMF, 0-80 °C, then aq. NaOAc; also: N-methylformanilide",
    yield = { 65, 95 },
    cautions = { "phosphoryl chloride" },
    source = "Joule, Mills, Heterocyclic Chemistry; from memory",
    example { "COc1ccc2[nH]cc(C=O)c2c1", from = { "COc1ccc2[nH]ccc2c1", "CN(C)C=O" } },
    refuse { "O=Cc1ccccc1" }, -- benzene is not reactive enough
}

disconnection "reimer-tiemann" {
    about = "Reimer-Tiemann reaction; ortho to the phenol",
    rxno = "RXNO:0000072",
    target = "[OX2H1:1]-[c;$(c1ccccc1):2]:[c;!$(c1:c:c(-" .. PULL .. "):c:c:c:1);!$(c1:c(-" .. PULL ..
        "):c:c:c:c:1);!$(c1:c:c:c(-" .. PULL ..
        "):c:c:1);!$(c1:c:c:n:c:c:1);!$(c:n);!$(c:c:n):3]-[CX3;H1:4]=O",
    from = "[O:1]-[c:2]:[cH:3].[C:4](Cl)(Cl)Cl",
    conditions = "base-aq-strong",
    also_attacks = { "ester", "aldehyde", "alkyl halide", "primary amine" },
    recipe = "CHCl3, aq. NaOH, 60-70 °C",
    yield = { 20, 50 },
    cautions = { "chloroform", "sodium hydroxide" },
    source = "Vogel's Textbook of Practical Organic Chemistry; from memory",
    example { "Cc1ccc(O)c(C=O)c1", from = { "Cc1ccc(O)cc1", "ClC(Cl)Cl" } },
    refuse { "O=Cc1ccc(OC)cc1" }, -- no free phenol ortho to the aldehyde
}

disconnection "kolbe-schmitt" {
    about = "Kolbe-Schmitt reaction; ortho with sodium, para with potassium",
    rxno = "RXNO:0000182",
    target = "[OX2H1:1]-[c;$(c1ccccc1):2]:[c;!$(c1:c:c(-" .. PULL .. "):c:c:c:1);!$(c1:c(-" .. PULL ..
        "):c:c:c:c:1);!$(c1:c:c:c(-" .. PULL ..
        "):c:c:1);!$(c1:c:c:n:c:c:1);!$(c:n);!$(c:c:n):3]-[CX3:4](=[OX1:5])-[OX2H1:6]",
    from = "[O:1]-[c:2]:[cH:3].[C:4](=[O:5])=[O:6]",
    conditions = "base-aq-strong",
    also_attacks = { "ester", "alkyl halide", "nitro" },
    recipe = "NaOPh dry, CO2 5-100 bar, 125-180 °C, then acid",
    yield = { 50, 85 },
    cautions = { "carbon dioxide under pressure" },
    source = "March's Advanced Organic Chemistry; from memory",
    example { "Cc1ccc(O)c(C(=O)O)c1", from = { "Cc1ccc(O)cc1", "O=C=O" } },
    refuse { "O=C(O)c1cccc(O)c1" }, -- meta to the phenol
}

interconversion "sandmeyer-chloride" {
    about = "Sandmeyer chlorination; ipso",
    rxno = "RXNO:0000610",
    target = "[c;$(c1ccccc1),$(c1:c:n:c:c:c:1):1]-Cl",
    from = "[c:1]N",
    conditions = "diazotisation",
    also_attacks = { "other primary amine", "phenol", "other electron-rich arene", "alkene" },
    recipe = "NaNO2, HCl, 0 °C, then CuCl, HCl",
    yield = { 65, 85 },
    cautions = { "diazonium salt", "sodium nitrite" },
    source = "Vogel's Textbook of Practical Organic Chemistry; from memory",
    example { "Cc1ccc(Cl)c([N+](=O)[O-])c1", from = { "Cc1ccc(N)c([N+](=O)[O-])c1" } },
    refuse { "ClCc1ccccc1" }, -- chlorine not on the ring
}

interconversion "sandmeyer-bromide" {
    about = "Sandmeyer bromination; ipso",
    rxno = "RXNO:0000611",
    target = "[c;$(c1ccccc1),$(c1:c:n:c:c:c:1):1]-Br",
    from = "[c:1]N",
    conditions = "diazotisation",
    also_attacks = { "other primary amine", "phenol", "other electron-rich arene", "alkene" },
    recipe = "NaNO2, HBr, 0 °C, then CuBr, HBr; tBuONO, CuBr2, MeCN",
    yield = { 65, 85 },
    cautions = { "diazonium salt", "sodium nitrite" },
    source = "Vogel's Textbook of Practical Organic Chemistry; from memory",
    example { "COC(=O)c1ccc(Br)c(C)c1", from = { "COC(=O)c1ccc(N)c(C)c1" } },
    refuse { "BrCc1ccccc1" }, -- bromine not on the ring
}

disconnection "sandmeyer-cyanide" {
    about = "Sandmeyer cyanation; ipso",
    rxno = "RXNO:0000334",
    target = "[c;$(c1ccccc1),$(c1:c:n:c:c:c:1):1]-[CX2;+0:2]#[NX1:3]",
    from = "[c:1]N.[Na+].[C-:2]#[N:3]",
    conditions = "diazotisation",
    also_attacks = { "other primary amine", "phenol", "other electron-rich arene" },
    recipe = "NaNO2, HCl, 0 °C, neutralise, CuCN (CuCl and NaCN), 0-60 °C",
    yield = { 55, 75 },
    cautions = { "sodium cyanide", "copper(I) cyanide", "hydrogen cyanide", "diazonium salt" },
    source = "Vogel's Textbook of Practical Organic Chemistry; from memory",
    example { "Cc1ccc(C#N)cc1", from = { "Cc1ccc(N)cc1", "[Na+].[C-]#N" } },
    refuse { "N#CCc1ccccc1" }, -- nitrile not on the ring
}

interconversion "balz-schiemann" {
    about = "Balz-Schiemann reaction; ipso",
    rxno = "RXNO:0000127",
    target = "[c;$(c1ccccc1),$(c1:c:n:c:c:c:1):1]-F",
    from = "[c:1]N",
    conditions = "diazotisation",
    also_attacks = { "other primary amine", "phenol", "other electron-rich arene" },
    recipe = "NaNO2, HBF4, 0 °C, then dry salt, heat; HF·pyridine",
    yield = { 50, 75 },
    cautions = { "diazonium tetrafluoroborate (dry: may decompose violently)", "boron trifluoride" },
    source = "Vogel's Textbook of Practical Organic Chemistry; from memory",
    example { "CCOC(=O)c1ccc(F)cc1", from = { "CCOC(=O)c1ccc(N)cc1" } },
    refuse { "FC(F)(F)c1ccccc1" }, -- fluorine not on the ring
}

interconversion "diazonium-iodide" {
    about = "Aryl iodide from a diazonium salt; ipso, no copper needed",
    rxno = "RXNO:0000612",
    target = "[c;$(c1ccccc1),$(c1:c:n:c:c:c:1):1]-I",
    from = "[c:1]N",
    conditions = "diazotisation",
    also_attacks = { "other primary amine", "phenol", "other electron-rich arene" },
    recipe = "NaNO2, HCl or TsOH, 0 °C, then KI",
    yield = { 70, 90 },
    cautions = { "diazonium salt (some with iodide precipitate explosive solids)" },
    source = "Vogel's Textbook of Practical Organic Chemistry; from memory",
    example { "O=C(O)c1ccccc1I", from = { "Nc1ccccc1C(=O)O" } },
    refuse { "ICc1ccccc1" }, -- iodine not on the ring
}

interconversion "diazonium-phenol" {
    about = "Phenol from a diazonium salt; ipso",
    target = "[c;$(c1ccccc1),$(c1:c:n:c:c:c:1):1]-[OX2H1]",
    from = "[c:1]N",
    conditions = "diazotisation",
    also_attacks = { "other primary amine", "other phenol" },
    recipe = "NaNO2, aq. H2SO4, 0 °C, then boil; Cu2O, Cu(NO3)2 at rt",
    yield = { 60, 85 },
    cautions = { "diazonium salt", "sulfuric acid" },
    source = "Vogel's Textbook of Practical Organic Chemistry; from memory",
    example { "Oc1cccc([N+](=O)[O-])c1", from = { "Nc1cccc([N+](=O)[O-])c1" } },
    refuse { "OCc1ccccc1" }, -- hydroxyl group not on the ring
}

interconversion "deamination" {
    about = "Reductive deamination of an aniline; ipso; makes meta patterns that the amine directed",
    target = "[cH;$(c(:c-[Cl,Br,$([N+](=O)[O-])]):c-[Cl,Br,$([N+](=O)[O-]),CX4]):1]",
    from = "[c:1]N",
    conditions = "diazotisation",
    also_attacks = { "other primary amine", "phenol" },
    recipe = "NaNO2, acid, 0 °C, then H3PO2; tBuONO, THF",
    yield = { 60, 85 },
    cautions = { "diazonium salt", "hypophosphorous acid" },
    source = "Vogel's Textbook of Practical Organic Chemistry; from memory",
    example { "Cc1cc(Br)cc([N+](=O)[O-])c1", from = { "Cc1cc(Br)c(N)c([N+](=O)[O-])c1" } },
    refuse { "Cc1ccc(Br)cc1" }, -- no second group that the lost amine put in place
}

disconnection "snar-amine" {
    about = "SNAr by an amine; ipso; para to nitro over ortho; F > Cl ≈ Br",
    target = "[c;$(c:c-" .. ACTIVATE .. "),$(c1:c:c:c(-" .. ACTIVATE ..
        "):c:c:1):1]-!@[NX3;+0;$(N(-c)-[CX4]);!$(N-[C,S]=[O,N,S]);!$(N(-c)-c):2]",
    cut = { 1, 2 },
    acceptor = { 1, "activated-aryl" },
    donor = { 2, "amine" },
    conditions = "amine-heat",
    also_attacks = { "other activated aryl fluoride", "alkyl halide", "acyl halide", "activated ester" },
    recipe = "amine, K2CO3 or DIPEA, DMSO or MeCN, 25-100 °C; also: Cl",
    yield = { 75, 95 },
    cautions = { "dimethyl sulfoxide" },
    source = "Clayden, Greeves, Warren, Organic Chemistry; from memory",
    example { "O=[N+]([O-])c1ccc(N2CCOCC2)c(F)c1", from = { "O=[N+]([O-])c1ccc(F)c(F)c1", "C1COCCN1" } },
    refuse { "CN(C)c1cccc([N+](=O)[O-])c1" }, -- the nitro group is meta: no stabilisation of the adduct
}

disconnection "snar-azine-amine" {
    about = "SNAr of a chloroazine by an amine; 4- over 2-position in pyrimidines and quinazolines",
    target = "[c;$(c1:n:c:c:c:c:1),$(c1:n:c:c:c:n:1),$(c1:n:c:n:c:c:1),$(c1:c:c:n:c:c:1),$(c1:n:c:c:n:c:1),$(c1:n:n:c:c:c:1);r6:1]-!@[NX3;+0;!$(N-[C,S]=[O,N,S]);!$(N=*):2]-[#6:3]",
    cut = { 1, 2 },
    acceptor = { 1, "activated-aryl" },
    donor = { 2, "amine" },
    conditions = "amine-heat",
    also_attacks = { "other chloroazine", "alkyl halide", "acyl halide", "activated ester" },
    recipe = "iPrOH or MeCN, reflux, DIPEA or HCl cat.; also: F, SMe, SO2Me",
    yield = { 70, 95 },
    source = "Joule, Mills, Heterocyclic Chemistry; from memory",
    example { "COc1cc2ncnc(Nc3cccc(Cl)c3F)c2cc1OC", from = { "COc1cc2ncnc(Cl)c2cc1OC", "Nc1cccc(Cl)c1F" } },
    refuse { "CNc1cccnc1" }, -- the 3-position of pyridine is not activated
}

disconnection "snar-alkoxide" {
    about = "SNAr by an alkoxide; ipso",
    target = "[c;$(c:c-" .. ACTIVATE .. "),$(c1:c:c:c(-" .. ACTIVATE ..
        "):c:c:1),$(c1:n:c:c:c:c:1),$(c1:n:c:c:c:n:1),$(c1:n:c:n:c:c:1),$(c1:c:c:n:c:c:1):1]-!@[OX2:2]-[CX4:3]",
    cut = { 1, 2 },
    acceptor = { 1, "activated-aryl" },
    donor = { 2, "alcohol" },
    conditions = "alkoxide",
    also_attacks = { "ester", "aldehyde", "alkyl halide", "acyl halide", "other activated aryl fluoride" },
    recipe = "NaH, THF or DMF, 0-60 °C; KOtBu; also: Cl",
    yield = { 70, 95 },
    cautions = { "sodium hydride" },
    source = "Clayden, Greeves, Warren, Organic Chemistry; from memory",
    example { "O=[N+]([O-])c1ccc(OCC2CCCO2)cc1", from = { "O=[N+]([O-])c1ccc(F)cc1", "OCC1CCCO1" } },
    refuse { "COc1cccc([N+](=O)[O-])c1" }, -- the nitro group is meta
}

disconnection "snar-thiolate" {
    about = "SNAr by a thiolate; ipso",
    target = "[c;$(c:c-" .. ACTIVATE .. "),$(c1:c:c:c(-" .. ACTIVATE ..
        "):c:c:1),$(c1:n:c:c:c:c:1),$(c1:n:c:c:c:n:1),$(c1:n:c:n:c:c:1),$(c1:c:c:n:c:c:1):1]-!@[SX2:2]-[#6:3]",
    cut = { 1, 2 },
    acceptor = { 1, "activated-aryl" },
    donor = { 2, "thiol" },
    conditions = "thiolate",
    also_attacks = { "alkyl halide", "acyl halide", "enone", "epoxide", "other activated aryl halide" },
    recipe = "K2CO3, DMF, 25-80 °C; also: F, Br",
    yield = { 75, 95 },
    cautions = { "thiol (stench)" },
    source = "Carey, Sundberg, Advanced Organic Chemistry Part B; from memory",
    example { "CCSc1ccc([N+](=O)[O-])cc1C#N", from = { "N#Cc1cc([N+](=O)[O-])ccc1Cl", "CCS" } },
    refuse { "CSc1cccc([N+](=O)[O-])c1" }, -- the nitro group is meta
}

disconnection "snar-phenoxide" {
    about = "Diaryl ether by SNAr; ipso",
    target = "[c;$(c:c-" .. ACTIVATE .. "),$(c1:c:c:c(-" .. ACTIVATE .. "):c:c:1):1]-!@[OX2:2]-[c:3]",
    cut = { 1, 2 },
    acceptor = { 1, "activated-aryl" },
    donor = { 2, "phenol" },
    conditions = "base-aq-mild",
    also_attacks = { "alkyl halide", "acyl halide", "other activated aryl halide" },
    recipe = "K2CO3, DMF or DMSO, 80-140 °C; also: Cl, NO2",
    yield = { 75, 95 },
    source = "Carey, Sundberg, Advanced Organic Chemistry Part B; from memory",
    example { "N#Cc1ccc(Oc2ccc(Cl)cc2)cc1", from = { "N#Cc1ccc(F)cc1", "Oc1ccc(Cl)cc1" } },
    refuse { "c1ccc(Oc2ccccc2)cc1" }, -- neither ring carries an acceptor: Ullmann or palladium
}

interconversion "benzylic-bromination" {
    about = "Side-chain bromination; benzylic C-H, one bromine (dibromide is the rival)",
    rxno = "RXNO:0000225",
    target = "[c:1]-[CX4;H1,H2;!$(C(Br)Br):2]-Br",
    from = "[c:1][C:2]",
    conditions = "nbs-radical",
    also_attacks = { "alkene", "other benzylic C-H", "phenol", "primary amine", "thiol", "aldehyde" },
    recipe = "NBS, AIBN or (BzO)2, CCl4 or chlorobenzene or MeCN, 80 °C, light",
    yield = { 60, 85 },
    cautions = { "N-bromosuccinimide", "dibenzoyl peroxide" },
    source = "Vogel's Textbook of Practical Organic Chemistry; from memory",
    example { "N#Cc1ccccc1-c1ccc(CBr)cc1", from = { "Cc1ccc(-c2ccccc2C#N)cc1" } },
    refuse { "BrCCc1ccccc1" }, -- not benzylic
}

interconversion "sidechain-oxidation" {
    about = "Oxidation of an arylalkane to the acid; any benzylic C-H chain ends as CO2H",
    rxno = "RXNO:0000354",
    target = "[c:1]-[CX3:2](=O)-[OX2H1]",
    from = "[c:1][C:2]",
    conditions = "kmno4",
    also_attacks = { "free alcohol", "aldehyde", "alkene", "primary amine", "phenol", "sulfide",
        "other side chain" },
    recipe = "KMnO4, aq. pyridine or Na2CO3, reflux; CrO3, AcOH; O2, Co",
    yield = { 55, 85 },
    cautions = { "potassium permanganate", "chromium trioxide" },
    source = "Vogel's Textbook of Practical Organic Chemistry; from memory",
    example { "O=C(O)c1ccc([N+](=O)[O-])cc1", from = { "Cc1ccc([N+](=O)[O-])cc1" } },
    refuse { "O=C(O)Cc1ccccc1" }, -- the chain is cut to one carbon, never to two
}

interconversion "clemmensen" {
    about = "Clemmensen reduction of an aryl ketone; C=O to CH2; acid-stable substrates",
    rxno = "RXNO:0000038",
    target = "[c:1]-[CX4;H2:2]-[CX4;!$(C-[OX2,NX3,F,Cl,Br,I]);!$(C-[CX3]=O):3]",
    from = "[c:1][C:2](=O)[C:3]",
    conditions = "clemmensen",
    also_attacks = { "nitro", "alkene", "acid-labile acetal", "free alcohol", "other ketone" },
    recipe = "Zn(Hg), conc. HCl, toluene, reflux; also: Et3SiH, TFA",
    yield = { 60, 85 },
    cautions = { "zinc amalgam (mercury)", "hydrochloric acid" },
    source = "Vogel's Textbook of Practical Organic Chemistry; from memory",
    example { "O=C(O)CCCc1ccc(F)cc1", from = { "O=C(O)CCC(=O)c1ccc(F)cc1" } },
    refuse { "NCCc1ccccc1" }, -- an α-amino ketone is cleaved at the C-N bond
}

interconversion "wolff-kishner" {
    about = "Wolff-Kishner reduction of a ketone; C=O to CH2; base-stable substrates (Huang-Minlon)",
    rxno = "RXNO:0000227",
    target = "[c:1]-[CX4;H2:2]-[#6;$([CX4]),$(c);!$([CX4]-[OX2,NX3,F,Cl,Br,I]);!$([CX4]-[CX3]=O):3]",
    from = "[c:1][C:2](=O)[#6:3]",
    conditions = "wolff-kishner",
    also_attacks = { "ester", "nitrile", "alkyl halide", "nitro", "activated aryl halide", "other ketone",
        "aldehyde" },
    recipe = "N2H4·H2O, KOH, diethylene glycol, 180-200 °C",
    yield = { 65, 90 },
    cautions = { "hydrazine", "potassium hydroxide" },
    source = "Vogel's Textbook of Practical Organic Chemistry; from memory",
    example { "CN(C)c1ccc(CCC2CCCCC2)cc1", from = { "CN(C)c1ccc(C(=O)CC2CCCCC2)cc1" } },
    refuse { "OCCc1ccccc1" }, -- an α-hydroxy ketone loses its oxygen by elimination (Kishner)
}

interconversion "mandelic-oxidative-decarboxylation" {
    about = "Aldehyde by oxidative decarboxylation of a mandelic acid; no isomers to expect",
    target = "[c:1][C;X3;H1:2]=[O:3]",
    from = "[c:1][C;H1:2]([O;H1:3])C(=O)O",
    conditions = "base-aq-strong",
    also_attacks = { "thiol", "hydroquinone", "primary amine", "other benzylic alcohol" },
    recipe = "CuSO4 or Cu(OH)2, aq. NaOH, air, 90 °C, then acid; also: MnO2/H2SO4, NaIO4",
    yield = { 70, 90 },
    cautions = { "sodium hydroxide" },
    source = "Kleemann and Engel, Pharmaceutical Substances; from memory",
    example { "COc1cc(C=O)ccc1O", from = { "COc1cc(ccc1O)C(O)C(=O)O" } },
    refuse { "O=CCc1ccccc1" }, -- carbonyl carbon is not on the ring
}

disconnection "gem-diacetate-from-methylarene" {
    about = "Aryl gem-diacetate from a methylarene; stops at the aldehyde stage",
    rxno = "RXNO:0000354",
    target = "[c:1][C;X4;H1:2]([O:3][C:4](=[O:5])[C;H3:6])[O:7][C:8](=[O:9])[C;H3:10]",
    from = "[c:1][C;H3:2].[O:3]([C:4](=[O:5])[C:6])C(C)=O.[O:7]([C:8](=[O:9])[C:10])C(C)=O",
    conditions = "chromic",
    also_attacks = { "free alcohol", "aldehyde", "alkene", "primary amine", "phenol", "thioether",
        "other methyl group" },
    recipe = "CrO3, Ac2O, H2SO4, below 10 °C",
    yield = { 40, 65 },
    cautions = { "sulfuric acid", "acetic anhydride", "chromium trioxide" },
    source = "Vogel's Textbook of Practical Organic Chemistry; from memory",
    example { "CC(=O)OC(OC(C)=O)c1ccc(cc1Cl)[N+](=O)[O-]", from = { "Cc1ccc(cc1Cl)[N+](=O)[O-]", "CC(=O)OC(C)=O", "CC(=O)OC(C)=O" } },
    refuse { "CC(=O)OCc1ccccc1" }, -- only one acetoxy group
}

-- The anhydride instead of the chloride; hydrogen fluoride or aluminium chloride.
disconnection "fc-acetylation-anhydride" {
    about = "Friedel-Crafts acetylation with acetic anhydride; para",
    target = "[c;$(c1:c:c:c(-" .. GIVE .. "):c:c:1),$(c1(-*):[cH]:[cH]:[cH]:[cH]:[cH]:1);" ..
        "!$(c1:c:c(-" .. PULL .. "):c:c:c:1);!$(c1:c(-" .. PULL .. "):c:c:c:c:1);" ..
        "!$(c1:c:c:c(-" .. PULL .. "):c:c:1);!$(c:n);!$(c:c:n):1]-!@[CX3:2](=[OX1:3])-[CH3:4]",
    cut = { 2, 1 },
    acceptor = { 2, "acetyl" },
    donor = { 1, "arene" },
    conditions = "lewis-acid",
    also_attacks = { "amine", "alcohol", "tert-butyl ether" },
    recipe = "Ac2O, AlCl3 (2 eq.), CH2Cl2, 0 °C to reflux; on plant scale HF",
    yield = { 75, 95 },
    cautions = { "aluminium chloride", "acetic anhydride" },
    source = "Vogel's Textbook of Practical Organic Chemistry; from memory",
    example { "CC(=O)c1ccc(OC)cc1", from = { "COc1ccccc1", "CC(=O)OC(C)=O" } },
    refuse { "CC(=O)c1cccc([N+](=O)[O-])c1" }, -- nitrobenzene does not react
}

-- Biphenyls take the acyl group para to the other ring.
disconnection "fc-acylation-biphenyl" {
    about = "Friedel-Crafts acylation of a biphenyl; para to the other ring",
    target = "[c;$(c1:[cH]:[cH]:c(-c2:[cH]:[cH]:[cH]:[cH]:[cH]:2):[cH]:[cH]:1):1]-!@[CX3;!R:2](=[OX1:3])-[#6;!$([#6]=O):4]",
    cut = { 2, 1 },
    acceptor = { 2, "acyl" },
    donor = { 1, "arene" },
    conditions = "lewis-acid",
    also_attacks = { "amine", "alcohol", "tert-butyl ether" },
    recipe = "acid chloride, AlCl3, CS2 or CH2Cl2, 0 °C to reflux",
    yield = { 70, 90 },
    cautions = { "aluminium chloride" },
    source = "common practice, no source",
    example { "CC(=O)c1ccc(-c2ccccc2)cc1", from = { "c1ccc(-c2ccccc2)cc1", "CC(=O)Cl" } },
    refuse { "CC(=O)c1cccc(-c2ccccc2)c1" }, -- meta to the other ring
}

-- What the lost amino group put in place: an ortho halogen or nitro group beside a para alkyl group.
interconversion "deamination-para-methyl" {
    about = "Reductive deamination of an aniline that had put a halogen ortho to itself, para to an alkyl group",
    target = "[cH;$(c1:c(-[Cl,Br,I,$([N+](=O)[O-])]):c:c(-[CX4]):c:c:1),$(c1:c(-[Cl,Br,I,$([N+](=O)[O-])]):c:c:c(-[CX4]):c:1);" ..
        "$(c1:c:c:c(-[CX4]):c:c:1):1]",
    from = "[c:1]N",
    conditions = "diazotisation",
    also_attacks = { "other primary amine", "hydrazine" },
    recipe = "NaNO2, H2SO4, EtOH, 0-5 °C, then Cu, warm; or H3PO2",
    yield = { 60, 80 },
    cautions = { "sodium nitrite" },
    source = "Bigelow, Johnson, Sandborn, Org. Synth. Coll. Vol. 1, 133; from memory",
    example { "Cc1cccc(Br)c1", from = { "Cc1ccc(N)c(Br)c1" } },
    refuse { "Cc1ccccc1" }, -- no group that the amine would have directed
}
