-- Grignard, organolithium and cuprate reactions.
-- Yields are typical ranges and sources stand from memory unless a source says otherwise.

pack {
    name = "organometallic",
    version = "0.1.0",
    licence = "CC0-1.0",
    about = "Grignard, organolithium and cuprate reactions",
    needs = { "synthons" },
}

-- A carbon that can bear magnesium or lithium: nothing on it or near it that eliminates or reacts.
local CARBANION = "[#6;!$([#6]=[O,N,S]);!$([#6]#[N,C]);!$([#6]-[O,N,S,F,Cl,Br,I]);!$([CX4]-[CX4]-[F,Cl,Br,I]);!$([CX4](-[CX4]-[OX2,NX3])-[CX4]-[OX2,NX3]);!$([CX4]-[#6]=[O,N,S]);!$([CX4]-[CX2]#N);!$([CX4]~[#7+]);!$([CX4]-n);!$([CX4]-[CX4]-[NX3,n]);!$([CX4]-[CX4]-[CX3]=[OX1])"

-- The same, where a heteroatom two bonds away would eliminate too.
local CARBANION_STRICT = "[#6;!$([#6]=[O,N,S]);!$([#6]#[N,C]);!$([#6]-[O,N,S,F,Cl,Br,I]);!$([CX4]-[CX4]-[OX2,NX3,n,F,Cl,Br,I]);!$([CX4]-[CX2]#N);!$([CX4]~[#7+]);!$([CX4]-n);!$([CX4]-[CX4]-[CX3]=[OX1]);!$([CX4](-[#6]=[O,N,S])-[#6]=[O,N,S])"

disconnection "grignard-aldehyde" {
    about = "Grignard addition to an aldehyde; racemic unless the aldehyde is chiral (Felkin-Anh)",
    rxno = "RXNO:0000014",
    target = CARBANION .. ":1]-!@[CX4;H1;!R:2]([OX2H1:3])-[#6;!$([#6]=[O,N,S]);!$([#6]#[N,C]):4]",
    cut = { 2, 1 },
    acceptor = { 2, "hydroxyalkyl" },
    donor = { 1, "organomagnesium" },
    conditions = "grignard",
    also_attacks = { "free alcohol", "free acid", "primary amine", "secondary amine", "aldehyde", "ketone",
        "ester", "nitrile", "acyl halide", "epoxide", "nitro", "terminal alkyne" },
    recipe = "RMgBr, THF or Et2O, 0 °C to rt, aq. NH4Cl; also: MgCl, MgI, RLi at -78 °C",
    yield = { 65, 90 },
    cautions = { "magnesium alkyl halide", "diethyl ether" },
    source = "Clayden, Greeves, Warren, Organic Chemistry; from memory",
    example { "COc1ccc(C(O)CC(C)C)cc1", from = { "CC(C)C[Mg]Br", "COc1ccc(C=O)cc1" } },
    refuse { "CCC(O)C#N" }, -- the other side would be an acyl cyanide: a cyanohydrin is made from cyanide and the aldehyde
}

disconnection "grignard-formaldehyde" {
    about = "Grignard addition to formaldehyde; one carbon more, primary alcohol",
    rxno = "RXNO:0000014",
    target = CARBANION .. ":1]-!@[CX4;H2;!$(C-[CX4]-c):2]-[OX2H1:3]",
    cut = { 2, 1 },
    acceptor = { 2, "hydroxyalkyl" },
    donor = { 1, "organomagnesium" },
    conditions = "grignard",
    also_attacks = { "free alcohol", "free acid", "primary amine", "secondary amine", "aldehyde", "ketone",
        "ester", "nitrile", "acyl halide", "epoxide", "nitro", "terminal alkyne" },
    recipe = "RMgBr, paraformaldehyde or gaseous formaldehyde, Et2O, rt; also: MgCl",
    yield = { 55, 75 },
    cautions = { "formaldehyde", "magnesium alkyl halide", "diethyl ether" },
    source = "Vogel's Textbook of Practical Organic Chemistry; from memory",
    example { "OCC1CCC(CC1)C(C)(C)C", from = { "CC(C)(C)C1CCC([Mg]Br)CC1", "C=O" } },
    refuse { "OCCc1ccccc1" }, -- benzylmagnesium halides attack by their ortho position
    refuse { "COC(=O)CO" }, -- a carbonyl carbon cannot carry the metal
}

disconnection "grignard-ketone" {
    about = "Grignard addition to a ketone; axial/equatorial mixtures in cyclohexanones; hindered pairs enolise or are reduced",
    rxno = "RXNO:0000014",
    target = CARBANION ..
        ":1]-!@[CX4;H0:2]([OX2H1:3])([#6;!$([#6]=[O,N,S]);!$([#6]#[N,C]):4])-[#6;!$([#6]=[O,N,S]);!$([#6]#[N,C]):5]",
    cut = { 2, 1 },
    acceptor = { 2, "hydroxyalkyl" },
    donor = { 1, "organomagnesium" },
    conditions = "grignard",
    also_attacks = { "free alcohol", "free acid", "primary amine", "secondary amine", "aldehyde", "ketone",
        "ester", "nitrile", "acyl halide", "epoxide", "nitro", "terminal alkyne" },
    recipe = "RMgBr, THF, 0 °C to rt, aq. NH4Cl; CeCl3 with enolisable ketones; also: MgCl, RLi",
    yield = { 60, 90 },
    cautions = { "magnesium alkyl halide", "diethyl ether" },
    source = "Clayden, Greeves, Warren, Organic Chemistry; from memory",
    example { "CCC1(O)CCN(Cc2ccccc2)CC1", from = { "CC[Mg]Br", "O=C1CCN(Cc2ccccc2)CC1" } },
    refuse { "CC(C)(O)C#N" }, -- would need an acyl cyanide
}

disconnection "grignard-ester-twice" {
    about = "Double Grignard addition to an ester; two equal groups enter; does not stop at the ketone",
    rxno = "RXNO:0000014",
    target = CARBANION .. ":1]-!@[CX4;H0;!R:2]([OX2H1:3])(-!@" .. CARBANION ..
        ":4])-[#6;!$([#6]=[O,N,S]);!$([#6]#[N,C]):5]",
    from = "[#6:1][Mg]Br.[#6:4][Mg]Br.[C:2](=[O:3])([#6:5])OCC",
    when = function(m) return m.atom[1].symmetry == m.atom[4].symmetry end,
    conditions = "grignard",
    also_attacks = { "free alcohol", "free acid", "primary amine", "secondary amine", "aldehyde", "ketone",
        "ester", "nitrile", "acyl halide", "epoxide", "nitro", "terminal alkyne" },
    recipe = "RMgBr (2.5 equiv. and one more for each acidic H), THF, 0 °C to reflux; also: methyl ester, RLi",
    yield = { 65, 90 },
    cautions = { "magnesium alkyl halide", "diethyl ether" },
    source = "Clayden, Greeves, Warren, Organic Chemistry; from memory",
    example { "CC(C)(O)c1ccc2[nH]ccc2c1", from = { "C[Mg]Br", "C[Mg]Br", "CCOC(=O)c1ccc2[nH]ccc2c1" } },
    refuse { "CCC(C)(O)c1ccccc1" }, -- the two groups 1 and 4 are the same
}

disconnection "grignard-nitrile-ketone" {
    about = "Ketone from nitrile and Grignard reagent; stops at the imine salt, one addition",
    rxno = "RXNO:0000014",
    target = CARBANION_STRICT .. ":1]-!@[CX3;!R:2](=O)-[#6;!$([#6]=[O,N,S]);!$([#6]#[N,C]):4]",
    from = "[#6:1][Mg]Br.[C:2](#N)[#6:4]",
    conditions = "grignard",
    also_attacks = { "free alcohol", "free acid", "primary amine", "secondary amine", "aldehyde", "ketone",
        "ester", "nitrile", "acyl halide", "epoxide", "nitro", "terminal alkyne" },
    recipe = "RMgBr, Et2O or toluene, reflux (CuBr cat.), then aq. HCl; also: RLi",
    yield = { 55, 85 },
    cautions = { "magnesium alkyl halide", "diethyl ether" },
    source = "March's Advanced Organic Chemistry; from memory",
    example { "CCCC(=O)c1cccc(OC)c1", from = { "CCC[Mg]Br", "COc1cccc(C#N)c1" } },
    refuse { "O=C1CCCCC1" }, -- both carbons are in the ring, no open-chain nitrile stands for it
}

disconnection "grignard-carboxylation" {
    about = "Carboxylation of a Grignard reagent; retention of the carbon skeleton, one carbon more",
    rxno = "RXNO:0000014",
    target = CARBANION_STRICT .. ":1]-!@[CX3:2](=[OX1:3])-[OX2H1:4]",
    cut = { 2, 1 },
    acceptor = { 2, "carboxyl" },
    donor = { 1, "organomagnesium" },
    conditions = "grignard",
    also_attacks = { "free alcohol", "free acid", "primary amine", "secondary amine", "aldehyde", "ketone",
        "ester", "nitrile", "acyl halide", "epoxide", "nitro", "terminal alkyne" },
    recipe = "RMgBr, solid CO2, THF, then aq. HCl; also: MgCl, RLi (with excess CO2)",
    yield = { 65, 90 },
    cautions = { "magnesium alkyl halide", "diethyl ether" },
    source = "Vogel's Textbook of Practical Organic Chemistry; from memory",
    example { "COc1ccc(C(=O)O)c(C)c1", from = { "COc1ccc([Mg]Br)c(C)c1", "O=C=O" } },
    refuse { "CCOC(=O)CC(=O)O" }, -- the organometallic would be an ester enolate
}

disconnection "grignard-epoxide" {
    about = "Opening of an epoxide by an organometallic; attack at the less hindered CH2, configuration at the C-O carbon kept",
    rxno = "RXNO:0000014",
    target = CARBANION_STRICT .. ":1]-!@[CX4;H2:2]-[CX4;!$(C([O,N])[O,N]):3]-[OX2H1:4]",
    cut = { 2, 1 },
    acceptor = { 2, "oxirane" },
    donor = { 1, "organomagnesium" },
    conditions = "grignard",
    also_attacks = { "free alcohol", "free acid", "primary amine", "secondary amine", "aldehyde", "ketone",
        "ester", "nitrile", "acyl halide", "epoxide", "nitro", "terminal alkyne" },
    recipe = "RMgBr, CuI or CuCN cat., THF, -20 °C; also: RLi with BF3·OEt2",
    yield = { 60, 85 },
    cautions = { "ethylene oxide", "magnesium alkyl halide", "diethyl ether" },
    source = "Carey, Sundberg, Advanced Organic Chemistry Part B; from memory",
    example { "OCCc1ccc(F)cc1", from = { "Fc1ccc([Mg]Br)cc1", "C1CO1" } },
    refuse { "CC(CO)c1ccccc1" }, -- attack would have to come at the more hindered carbon
}

disconnection "weinreb-ketone" {
    about = "Weinreb ketone synthesis; one addition only: the chelate stands until work-up",
    target = CARBANION_STRICT .. ":1]-!@[CX3;!R:2](=[OX1:3])-[#6;!$([#6]=[O,N,S]);!$([#6]#[N,C]):4]",
    from = "[#6:1][Mg]Br.[C:2](=[O:3])([#6:4])N(C)OC",
    conditions = "grignard",
    also_attacks = { "urea", "secondary amide", "free alcohol", "free acid", "aldehyde", "ketone", "acyl halide", "nitro",
        "terminal alkyne" },
    recipe = "RMgBr or RLi, THF, -78 to 0 °C, aq. NH4Cl",
    yield = { 75, 95 },
    cautions = { "magnesium alkyl halide" },
    source = "Nahm, Weinreb, Tetrahedron Lett. 1981, 22, 3815; from memory",
    example { "O=C(CCCCl)c1ccc(F)cc1", from = { "Fc1ccc([Mg]Br)cc1", "CON(C)C(=O)CCCCl" } },
    refuse { "CC(=O)C(C)=O" }, -- a 1,2-diketone: the donor would be an acyl anion
}

disconnection "cuprate-conjugate-addition" {
    about = "Conjugate addition of an organocuprate; 1,4-addition; trans to a ring substituent next to it",
    rxno = "RXNO:0000008",
    target = CARBANION ..
        ":1]-!@[CX4;!r3:2]-[CX4;!H0;!$(C-[O,N,S,F,Cl,Br,I]);!r3:3]-[CX3;$(C([#6])[#6]):4]=[OX1:5]",
    cut = { 2, 1 },
    acceptor = { 2, "beta-acceptor" },
    donor = { 1, "organolithium" },
    conditions = "cuprate",
    also_attacks = { "free alcohol", "free acid", "aldehyde", "alkyl iodide", "allylic halide", "acyl halide",
        "epoxide", "enone" },
    recipe = "R2CuLi or RMgBr with CuI cat., Et2O, -78 to 0 °C (TMSCl for hindered enones); alkynyl is not transferred",
    yield = { 70, 95 },
    cautions = { "butyllithium", "copper(I) iodide" },
    source = "Carey, Sundberg, Advanced Organic Chemistry Part B; from memory",
    example { "CC1(c2ccc3c(c2)OCO3)CCCC(=O)C1", from = { "[Li]c1ccc2c(c1)OCO2", "CC1=CC(=O)CCC1" } },
    refuse { "CCCC(=O)OCC" }, -- enoates are poor acceptors for a plain cuprate
}

disconnection "acetylide-alkylation" {
    about = "Alkylation of an acetylide; SN2 at primary carbon",
    target = "[CX2:1]#[CX2:2]-!@[CX4;H2,H3;!$(C-[O,N,S,F,Cl,Br,I]);!$(C-C-[OX2H1]);!$([CX4][CX4]([#6])([#6])[#6]):3]",
    cut = { 3, 2 },
    acceptor = { 3, "alkyl" },
    donor = { 2, "acetylide" },
    conditions = "organolithium",
    also_attacks = { "free alcohol", "free acid", "aldehyde", "ketone", "ester", "alkyl halide",
        "acyl halide", "epoxide" },
    recipe = "NaNH2, liq. NH3, or BuLi, THF/HMPA or DMPU, -78 °C to rt; also: I, OTs",
    yield = { 60, 85 },
    cautions = { "sodium amide", "acetylene", "butyllithium" },
    source = "Carey, Sundberg, Advanced Organic Chemistry Part B; from memory",
    example { "C#CCCCCCOC1CCCCO1", from = { "C#C", "BrCCCCCOC1CCCCO1" } },
    refuse { "C#CC(C)(C)C" }, -- tertiary (and most secondary) halides eliminate
}

disconnection "acetylide-addition" {
    about = "Addition of an acetylide to a carbonyl compound (Favorskii-Reppe); from the less hindered face (17α in estrones)",
    rxno = "RXNO:0000655",
    target = "[CX2:1]#[CX2:2]-!@[CX4;H0,H1:3]([OX2H1:4])-[#6;!$([#6]=[O,N,S]);!$([#6]#[N,C]):5]",
    cut = { 3, 2 },
    acceptor = { 3, "hydroxyalkyl" },
    donor = { 2, "acetylide" },
    conditions = "organolithium",
    also_attacks = { "free acid", "aldehyde", "ketone", "acyl halide", "ester" },
    recipe = "HC≡CMgBr, HC≡CLi·en or KOH/acetylene, THF, 0 °C; phenols and alcohols take one more equivalent",
    yield = { 70, 95 },
    cautions = { "acetylene" },
    source = "March's Advanced Organic Chemistry; from memory",
    example { "C[C@]12CC[C@H]3[C@@H](CCc4cc(O)ccc43)[C@@H]1CC[C@@]2(O)C#C", from = { "C#C", "C[C@]12CC[C@H]3[C@@H](CCc4cc(O)ccc43)[C@@H]1CCC2=O" } },
    refuse { "C#CC(O)C(=O)OCC" }, -- would need a glyoxylate: the ester competes
}

interconversion "grignard-formation" {
    about = "Preparation of a Grignard reagent; configuration at an sp3 carbon is lost",
    target = "[#6;!$([CX2]);!$([CX4]-[CX4]-[OX2,NX3,F,Cl,Br,I]);!$([#6]-[O,N,F,Cl,Br,I]):1]-[Mg]Br",
    from = "[#6:1]Br",
    conditions = "grignard",
    also_attacks = { "free alcohol", "free acid", "primary amine", "secondary amine", "aldehyde", "ketone",
        "ester", "nitrile", "acyl halide", "epoxide", "nitro", "terminal alkyne" },
    recipe = "Mg turnings, I2 or 1,2-dibromoethane, THF or Et2O, reflux; also: Cl, I",
    yield = { 80, 95 },
    cautions = { "magnesium alkyl halide", "diethyl ether" },
    source = "Vogel's Textbook of Practical Organic Chemistry; from memory",
    example { "COc1ccc([Mg]Br)cc1", from = { "COc1ccc(Br)cc1" } },
    refuse { "CCOC([Mg]Br)C" }, -- α-alkoxy reagents decompose
}

interconversion "arylboronic-acid" {
    about = "Boronic acid from an organometallic and trimethyl borate; ipso",
    target = "[c:1]-[BX3:2]([OX2H1:3])-[OX2H1:4]",
    from = "[c:1][Mg]Br.[B:2]([O:3]C)([O:4]C)OC",
    conditions = "grignard",
    also_attacks = { "free alcohol", "free acid", "primary amine", "secondary amine", "aldehyde", "ketone",
        "ester", "nitrile", "acyl halide", "epoxide", "nitro", "terminal alkyne" },
    recipe = "B(OMe)3 or B(OiPr)3, THF, -78 °C, then aq. HCl; also: ArLi",
    yield = { 55, 85 },
    cautions = { "butyllithium" },
    source = "Vogel's Textbook of Practical Organic Chemistry; from memory",
    example { "OB(O)c1ccc(OCc2ccccc2)cc1", from = { "Br[Mg]c1ccc(OCc2ccccc2)cc1", "COB(OC)OC" } },
    refuse { "CCCCB1OC(C)(C)C(C)(C)O1" }, -- an ester and an alkyl boron
}

disconnection "boronic-acid-by-halogen-metal-exchange" {
    about = "Arylboronic acid from the bromide through the Grignard or lithium reagent in one operation",
    target = "[c:1]-[BX3:2]([OX2H:3])-[OX2H:4]",
    from = "[c:1]Br.[B:2]([O:3]C)([O:4]C)OC",
    conditions = "organolithium",
    also_attacks = { "ketone", "aldehyde", "ester", "nitrile", "alcohol", "primary amine", "free acid" },
    recipe = "Mg, THF or BuLi, THF, -78 °C; B(OMe)3, -78 °C to rt; aqueous acid",
    yield = { 60, 85 },
    cautions = { "butyllithium" },
    source = "common practice, no source",
    example { "OB(O)c1ccccc1", from = { "Brc1ccccc1", "COB(OC)OC" } },
    refuse { "OB(O)CCc1ccccc1" }, -- an alkylboronic acid
}

disconnection "dmf-formylation" {
    about = "Formylation of an organometallic with DMF (Bouveault); one addition only",
    rxno = "RXNO:0000533",
    target = "[c,$([CX3]=[CX3]):1]-!@[CX3;H1:2]=[OX1:3]",
    cut = { 2, 1 },
    acceptor = { 2, "formyl" },
    donor = { 1, "organolithium" },
    conditions = "organolithium",
    also_attacks = { "amide", "epoxide" },
    recipe = "ArLi or ArMgBr, DMF, THF, -78 °C to rt, aq. acid; also: N-formylpiperidine",
    yield = { 65, 90 },
    cautions = { "butyllithium" },
    source = "March's Advanced Organic Chemistry; from memory",
    example { "Cc1ccsc1C=O", from = { "[Li]c1sccc1C", "CN(C)C=O" } },
    example { "O=Cc1cccs1", from = { "CN(C)C=O", "[Li]c1cccs1" } },
    refuse { "O=CCc1ccccc1" }, -- an aldehyde on an alkyl chain
}

disconnection "cuprate-acid-chloride" {
    about = "Ketone from acid chloride and cuprate; stops at the ketone; ester, nitrile and amide stand",
    target = CARBANION_STRICT .. ":1]-!@[CX3;!R:2](=[OX1:3])-[#6;!$([#6]=[O,N,S]);!$([#6]#[N,C]);!$([CX3]=[CX3]):4]",
    cut = { 2, 1 },
    acceptor = { 2, "acyl" },
    donor = { 1, "organolithium" },
    when = function(m) return not m.molecule:has "[CX3](=[OX1])[CX3]=[CX3]" end,
    conditions = "cuprate",
    also_attacks = { "urea", "secondary amide", "primary amide", "free alcohol", "phenol", "free acid", "enone" },
    recipe = "R2CuLi (from RLi and CuI), THF or Et2O, -78 °C",
    yield = { 65, 90 },
    cautions = { "butyllithium", "copper(I) iodide" },
    source = "Posner, Whitten, McFarland, J. Am. Chem. Soc. 1972, 94, 5106; from memory",
    example { "CCCCC(=O)CCCCC(=O)OC", from = { "[Li]CCCC", "COC(=O)CCCCC(=O)Cl" } },
    example { "CCCCC(=O)C1CCCCC1", from = { "[Li]CCCC", "O=C(Cl)C1CCCCC1" } },
    refuse { "CCCC(=O)OCC" }, -- an ester has no second carbon on the carbonyl
}

disconnection "reformatsky" {
    about = "Reformatsky reaction; little syn/anti selectivity with α-branched bromo esters",
    rxno = "RXNO:0000036",
    target = "[#6;!$([#6]=[O,N,S]);!$([#6]#[N,C]):1]-[CX4;H0,H1:2]([OX2H1:3])-!@[CX4;H1,H2:4]-[CX3:5](=[OX1:6])-[OX2:7]-[CX4:8]",
    from = "[#6:1][C:2]=[O:3].Br[C:4][C:5](=[O:6])[O:7][C:8]",
    conditions = "zn-acid",
    also_attacks = { "aldehyde", "ketone", "free acid" },
    recipe = "Zn (activated), THF or toluene, reflux; also: α-iodo ester, SmI2",
    yield = { 55, 85 },
    cautions = { "ethyl bromoacetate (lachrymator)", "zinc dust" },
    source = "Carey, Sundberg, Advanced Organic Chemistry Part B; from memory",
    example { "CCOC(=O)CC1(O)CCN(C(=O)OC(C)(C)C)CC1", from = { "O=C1CCN(C(=O)OC(C)(C)C)CC1", "CCOC(=O)CBr" } },
    example { "CCOC(=O)CC(O)c1ccccc1", from = { "O=Cc1ccccc1", "CCOC(=O)CBr" } },
    refuse { "CC(=O)CC(C)(C)O" }, -- a hydroxy ketone, not an ester: aldol
}

disconnection "barbier-allylation" {
    about = "Barbier allylation; reacts with allylic transposition; ester, amide and nitrile stand",
    rxno = "RXNO:0000084",
    target = "[#6;!$([#6]=[O,N,S]);!$([#6]#[N,C]):1]-[CX4;H0,H1:2]([OX2H1:3])-!@[CX4;H2:4]-[CX3;!R:5]=[CX3;H2:6]",
    from = "[#6:1][C:2]=[O:3].Br[C:4][C:5]=[C:6]",
    conditions = "zn-acid",
    also_attacks = { "aldehyde", "ketone" },
    recipe = "Zn or In, aq. NH4Cl/THF, rt; also: allyl chloride or iodide, Mg in Et2O",
    yield = { 65, 95 },
    cautions = { "allyl bromide" },
    source = "Kürti, Czakó, Strategic Applications of Named Reactions in Organic Synthesis; from memory",
    example { "C=CCC(O)c1ccc(C(=O)OC)cc1", from = { "COC(=O)c1ccc(C=O)cc1", "C=CCBr" } },
    example { "C=CCC1(O)CCCCC1", from = { "O=C1CCCCC1", "C=CCBr" } },
    refuse { "CC=CCC(O)c1ccccc1" }, -- a crotyl metal reacts at its γ carbon and gives the branched product
}

disconnection "acetylide-epoxide" {
    about = "Opening of an epoxide by an acetylide (Yamaguchi-Hirao); attack at the terminal carbon, configuration at C-O kept",
    target = "[CX2:1]#[CX2:2]-!@[CX4;H2:3]-[CX4;!$(C([O,N])[O,N]):4]-[OX2H1:5]",
    cut = { 3, 2 },
    acceptor = { 3, "oxirane" },
    donor = { 2, "acetylide" },
    conditions = "organolithium",
    recipe = "BuLi, BF3·OEt2, THF, -78 °C",
    yield = { 70, 90 },
    cautions = { "butyllithium", "boron trifluoride etherate" },
    source = "Yamaguchi, Hirao, Tetrahedron Lett. 1983, 24, 391; from memory",
    example { "CCCCC#CC[C@H](C)O", from = { "CCCCC#C", "C[C@H]1CO1" } },
    example { "OCCC#Cc1ccccc1", from = { "C#Cc1ccccc1", "C1CO1" } },
    refuse { "C#CC(C)CO" }, -- attack at the substituted carbon is disfavoured
}

disconnection "organolithium-aldimine" {
    about = "Addition of an organometallic to an aldimine; racemic",
    target = "[#6;!$([#6]=[O,N,S]);!$([#6]#[N,C]);!$([#6]-[O,N,S,F,Cl,Br,I]);!$([CX4]-[CX4]-[F,Cl,Br,I]);!$([CX4](-[CX4]-[OX2,NX3])-[CX4]-[OX2,NX3]);!$([CX4]-[#6]=[O,N,S]);!$([CX4]-[CX2]#N);!$([CX4]~[#7+]);!$([CX4]-n):1]-!@[CX4;H1;!R:2]([c:4])-[NX3;H1;!R;!$(N-[C,S]=O):3]-[#6:5]",
    from = "[#6:1][Li].[C:2]([c:4])=[N:3][#6:5]",
    conditions = "organolithium",
    also_attacks = { "amide", "epoxide" },
    recipe = "RLi or RMgX with BF3 or CeCl3, THF, -78 to 0 °C; enolisable imines deprotonate",
    yield = { 55, 85 },
    cautions = { "methyllithium" },
    source = "Carey, Sundberg, Advanced Organic Chemistry Part B; from memory",
    example { "CC(NCc1ccccc1)c1ccc(Cl)cc1", from = { "[Li]C", "Clc1ccc(C=NCc2ccccc2)cc1" } },
    example { "CCCCC(Nc1ccccc1)c1ccccc1", from = { "[Li]CCCC", "C(=Nc1ccccc1)c1ccccc1" } },
    refuse { "CC(NC(C)=O)c1ccccc1" }, -- N-acyl imines are not shelf compounds
}

interconversion "lithium-halogen-exchange" {
    about = "Bromine-lithium exchange; ipso; vinyl geometry kept",
    target = "[c,$([CX3]=[CX3]):1]-[Li]",
    from = "[#6:1]Br",
    conditions = "organolithium",
    also_attacks = { "amide", "epoxide" },
    recipe = "BuLi, THF, -78 °C; t-BuLi (2 equiv.) for vinyl; also: I",
    yield = { 85, 98 },
    cautions = { "butyllithium", "tert-butyllithium" },
    source = "Carey, Sundberg, Advanced Organic Chemistry Part B; from memory",
    example { "[Li]c1cccc2ccccc12", from = { "Brc1cccc2ccccc12" } },
    example { "[Li]c1ccc(OC)cc1", from = { "COc1ccc(Br)cc1" } },
    refuse { "[Li]CCCC" }, -- primary alkyl bromides couple with butyllithium instead: iodide and t-BuLi, or buy it
}

disconnection "grignard-aryl-alkyl-halide" {
    about = "Coupling of an aryl Grignard reagent with a primary alkyl bromide; no rearrangement",
    target = "[c;!$(c~n);!$(c~o):1]-!@[C;X4;H2:2][C;X4;H2;!$(C-[F,Cl,Br,I,O,N,S]):3]",
    from = "[c:1][Mg]Br.Br[C:2][C:3]",
    conditions = "grignard",
    also_attacks = { "nitrile" },
    recipe = "Li2CuCl4 (3 mol%), THF, 0 °C; also: FeCl3/TMEDA, CuI; tosylate, iodide",
    yield = { 65, 90 },
    source = "Carey and Sundberg, Advanced Organic Chemistry, Part B; from memory",
    example { "COc1cccc(CCCCCCO[Si](C)(C)C(C)(C)C)c1",
        from = { "COc1cccc([Mg]Br)c1", "BrCCCCCCO[Si](C)(C)C(C)(C)C" } },
    example { "CCCCCCc1ccccc1", from = { "Br[Mg]c1ccccc1", "BrCCCCCC" } },
    refuse { "CC(C)c1ccccc1" }, -- branched carbon: elimination competes
}

disconnection "aryl-grignard-bromopropionate" {
    about = "2-Arylpropionic acid from an aryl Grignard reagent and a 2-bromopropionate salt; racemic",
    target = "[c:1]-!@[C;X4;H1:2]([C;H3:3])[C;X3:4](=[O:5])[O;H1:6]",
    from = "[c:1][Mg]Br.Br[C:2]([C:3])[C:4](=[O:5])[O:6]",
    conditions = "grignard",
    also_attacks = { "nitrile" },
    recipe = "mixed magnesium chloride salt of 2-bromopropionic acid, THF/toluene, 10-55 °C",
    yield = { 60, 85 },
    source = "Kleemann and Engel, Pharmaceutical Substances; from memory",
    example { "COc1ccc2cc(ccc2c1)C(C)C(=O)O", from = { "COc1ccc2cc([Mg]Br)ccc2c1", "CC(Br)C(=O)O" } },
    example { "CC(C(=O)O)c1ccccc1", from = { "Br[Mg]c1ccccc1", "CC(Br)C(=O)O" } },
    refuse { "CC(C)(C(=O)O)c1ccccc1" }, -- quaternary carbon
}

disconnection "directed-ortho-borylation" {
    about = "Directed ortho metalation and borylation; ortho to the strongest directing group",
    target = "[c;$(c-[CX3](=O)[NX3]([CX4])[CX4]),$(c-[OX2]C(=O)[NX3]([CX4])[CX4]),$(c-[OX2][CX4;H2][OX2][CX4]),$(c-[NX3;H1]C(=O)OC(C)(C)C),$(c-[OX2][CH3]),$(c-F):1]:[c:2]-[B;X3:3]([O;H1:4])[O;H1:5]",
    from = "[c:1]:[cH:2].[B:3]([O;H0:4]C(C)C)([O;H0:5]C(C)C)OC(C)C",
    conditions = "organolithium",
    also_attacks = { "epoxide" },
    recipe = "sBuLi, TMEDA or LDA (amide, fluorine) with B(OiPr)3 present, THF, -78 °C, then acid; also: B(OMe)3",
    yield = { 60, 88 },
    cautions = { "sec-butyllithium", "lithium diisopropylamide" },
    source = "Carey and Sundberg, Advanced Organic Chemistry, Part B; from memory",
    example { "CCN(CC)C(=O)c1ccc(Cl)cc1B(O)O", from = { "CCN(CC)C(=O)c1ccc(Cl)cc1", "CC(C)OB(OC(C)C)OC(C)C" } },
    example { "OB(O)c1ccccc1C(=O)N(CC)CC", from = { "O=C(N(CC)CC)c1ccccc1", "CC(C)OB(OC(C)C)OC(C)C" } },
    refuse { "OB(O)c1cccc(c1)C(=O)N(C)C" }, -- meta to the directing group
}

interconversion "directed-ortho-iodination" {
    about = "Directed ortho metalation and iodination; ortho to the strongest directing group",
    target = "[c;$(c-[CX3](=O)[NX3]([CX4])[CX4]),$(c-[OX2]C(=O)[NX3]([CX4])[CX4]),$(c-[OX2][CX4;H2][OX2][CX4]),$(c-[NX3;H1]C(=O)OC(C)(C)C),$(c-[OX2][CH3]),$(c-F):1]:[c:2]-[I]",
    from = "[c:1]:[cH:2]",
    conditions = "organolithium",
    also_attacks = { "epoxide" },
    recipe = "tBuLi or nBuLi/TMEDA, THF, -78 °C, then I2; also: 1,2-diiodoethane, NIS",
    yield = { 65, 90 },
    cautions = { "tert-butyllithium", "iodine", "butyllithium" },
    source = "Carey and Sundberg, Advanced Organic Chemistry, Part B; from memory",
    example { "CC(C)(C)OC(=O)Nc1ccc(F)cc1I", from = { "CC(C)(C)OC(=O)Nc1ccc(F)cc1" } },
    example { "CCN(CC)C(=O)c1ccccc1I", from = { "CCN(CC)C(=O)c1ccccc1" } },
    refuse { "COc1cccc(I)c1" }, -- meta to the directing group
}

disconnection "directed-ortho-silylation" {
    about = "Directed ortho metalation and silylation; ortho to the strongest directing group; blocks that position",
    target = "[c;$(c-[CX3](=O)[NX3]([CX4])[CX4]),$(c-[OX2]C(=O)[NX3]([CX4])[CX4]),$(c-[OX2][CX4;H2][OX2][CX4]),$(c-[NX3;H1]C(=O)OC(C)(C)C),$(c-[OX2][CH3]),$(c-F):1]:[c:2]-[Si:3]([C;H3:4])([C;H3:5])[C;H3:6]",
    from = "[c:1]:[cH:2].[Si:3](Cl)([C:4])([C:5])[C:6]",
    conditions = "organolithium",
    also_attacks = { "epoxide" },
    recipe = "sBuLi, TMEDA, THF, -78 °C, then TMSCl; also: LDA with TMSCl present",
    yield = { 75, 95 },
    cautions = { "sec-butyllithium", "chlorotrimethylsilane" },
    source = "Carey and Sundberg, Advanced Organic Chemistry, Part B; from memory",
    example { "CCN(CC)C(=O)Oc1ccc(OC)cc1[Si](C)(C)C", from = { "CCN(CC)C(=O)Oc1ccc(OC)cc1", "C[Si](C)(C)Cl" } },
    example { "CCN(CC)C(=O)c1ccccc1[Si](C)(C)C", from = { "CCN(CC)C(=O)c1ccccc1", "C[Si](C)(C)Cl" } },
    refuse { "COc1cccc(c1)[Si](C)(C)C" }, -- meta to the directing group
}

disconnection "directed-ortho-thiolation" {
    about = "Directed ortho metalation and methylthiolation; ortho to the strongest directing group; methoxy and fluorine compete, depending on the base",
    target = "[c;$(c-[CX3](=O)[NX3]([CX4])[CX4]),$(c-[OX2]C(=O)[NX3]([CX4])[CX4]),$(c-[OX2][CX4;H2][OX2][CX4]),$(c-[NX3;H1]C(=O)OC(C)(C)C),$(c-[OX2][CH3]),$(c-F):1]:[c:2]-[S;X2:3][C;H3:4]",
    from = "[c:1]:[cH:2].[S:3]([C:4])S[C;H3]",
    conditions = "organolithium",
    also_attacks = { "epoxide" },
    recipe = "nBuLi, THF, -78 to 0 °C, then MeSSMe",
    yield = { 60, 85 },
    cautions = { "dimethyl disulfide", "butyllithium" },
    source = "Carey and Sundberg, Advanced Organic Chemistry, Part B; from memory",
    example { "COc1ccc(F)cc1SC", from = { "COc1ccc(F)cc1", "CSSC" } },
    example { "COc1ccccc1SC", from = { "COc1ccccc1", "CSSC" } },
    refuse { "COc1cccc(SC)c1" }, -- meta to the directing group
}

disconnection "directed-ortho-hydroxyalkylation" {
    about = "Directed ortho metalation and addition to an aldehyde; between two meta directing groups by preference",
    target = "[c;$(c-[CX3](=O)[NX3]([CX4])[CX4]),$(c-[OX2]C(=O)[NX3]([CX4])[CX4]),$(c-[OX2][CX4;H2][OX2][CX4]),$(c-[NX3;H1]C(=O)OC(C)(C)C),$(c-[OX2][CH3]),$(c-F):1]:[c:2]-!@[C;X4;H1:3]([O;H1:4])[#6;!$([#6]=O):5]",
    from = "[c:1]:[cH:2].[C;H1:3](=[O;H0:4])[#6:5]",
    conditions = "organolithium",
    also_attacks = { "epoxide" },
    recipe = "nBuLi, THF, -78 to 0 °C, then RCHO",
    yield = { 65, 88 },
    cautions = { "butyllithium" },
    source = "Carey and Sundberg, Advanced Organic Chemistry, Part B; from memory",
    example { "COc1cccc(OC)c1C(O)c1ccncc1", from = { "COc1cccc(OC)c1", "O=Cc1ccncc1" } },
    example { "CCN(CC)C(=O)c1ccccc1C(O)c1ccccc1", from = { "CCN(CC)C(=O)c1ccccc1", "O=Cc1ccccc1" } },
    refuse { "COc1cccc(c1)C(O)c1ccccc1" }, -- meta to the directing group
}

disconnection "boronic-acid-from-bromide" {
    about = "Arylboronic acid by bromine-lithium exchange; ipso",
    target = "[c:1]-[B;X3:2]([O;H1:3])[O;H1:4]",
    from = "[c:1]Br.[B:2]([O;H0:3]C(C)C)([O;H0:4]C(C)C)OC(C)C",
    conditions = "organolithium",
    also_attacks = { "epoxide" },
    recipe = "nBuLi added to ArBr and B(OiPr)3, THF/toluene, -78 to -40 °C, then aq. HCl; also: iPrMgCl·LiCl, B(OMe)3, iodide",
    yield = { 70, 92 },
    cautions = { "butyllithium", "hydrochloric acid" },
    source = "Carey and Sundberg, Advanced Organic Chemistry, Part B; from memory",
    example { "OB(O)c1cncc(c1)C1OCCO1", from = { "Brc1cncc(c1)C1OCCO1", "CC(C)OB(OC(C)C)OC(C)C" } },
    example { "OB(O)c1cncnc1", from = { "Brc1cncnc1", "CC(C)OB(OC(C)C)OC(C)C" } },
    refuse { "OB(O)CCc1ccccc1" }, -- an alkylboronic acid
}

disconnection "pinacol-boronate-from-bromide" {
    about = "Aryl pinacol boronate by bromine-lithium exchange; ipso",
    target = "[c:1]-[B;X3:2]1[O:3][C:4]([C;H3:5])([C;H3:6])[C:7]([C;H3:8])([C;H3:9])[O:10]1",
    from = "[c:1]Br.[B:2]1([O:3][C:4]([C:5])([C:6])[C:7]([C:8])([C:9])[O:10]1)OC(C)C",
    conditions = "organolithium",
    also_attacks = { "epoxide" },
    recipe = "nBuLi, THF, -78 °C, then iPrOBpin; also: iPrMgCl·LiCl, iodide",
    yield = { 70, 92 },
    cautions = { "butyllithium" },
    source = "Carey and Sundberg, Advanced Organic Chemistry, Part B; from memory",
    example { "COc1ccc(B2OC(C)(C)C(C)(C)O2)c(F)c1", from = { "COc1ccc(Br)c(F)c1", "CC(C)OB1OC(C)(C)C(C)(C)O1" } },
    example { "CC1(C)OB(OC1(C)C)c1cccnc1", from = { "Brc1cccnc1", "CC(C)OB1OC(C)(C)C(C)(C)O1" } },
    refuse { "CB1OC(C)(C)C(C)(C)O1" }, -- an alkyl boronate
}

disconnection "furan-thiophene-alkylation" {
    about = "Lithiation and alkylation of a furan or thiophene; α position",
    target = "[c;$(c1ccc[o,s]1):1]-!@[C;X4;H2;!$(C-[O,N,S,F,Cl,Br,I]);!$(C-[CX3]=O):2]",
    cut = { 2, 1 },
    acceptor = { 2, "alkyl" },
    donor = { 1, "arene" },
    conditions = "organolithium",
    also_attacks = { "epoxide" },
    recipe = "nBuLi, THF, -20 to 0 °C, then RBr; also: alkyl iodide",
    yield = { 70, 90 },
    cautions = { "furan", "butyllithium" },
    source = "Joule and Mills, Heterocyclic Chemistry; from memory",
    example { "CC(C)(C)[Si](C)(C)OCCCCCc1ccco1", from = { "c1ccoc1", "BrCCCCCO[Si](C)(C)C(C)(C)C" } },
    example { "CCCCCCc1cccs1", from = { "c1ccsc1", "BrCCCCCC" } },
    refuse { "CC(C)(C)c1ccco1" }, -- tertiary halide eliminates
}

disconnection "furan-thiophene-carbonyl-addition" {
    about = "Lithiation of a furan or thiophene and addition to an aldehyde; α position; racemic",
    target = "[c;$(c1ccc[o,s]1):1]-!@[C;X4;H1:2]([O;H1:3])[#6;!$([#6]=O):4]",
    cut = { 2, 1 },
    acceptor = { 2, "hydroxyalkyl" },
    donor = { 1, "arene" },
    conditions = "organolithium",
    also_attacks = { "epoxide" },
    recipe = "nBuLi, THF, -78 °C, then RCHO",
    yield = { 75, 92 },
    cautions = { "butyllithium" },
    source = "Joule and Mills, Heterocyclic Chemistry; from memory",
    example { "OC(c1cccs1)c1ccc(cc1)N(C)C", from = { "c1ccsc1", "CN(C)c1ccc(C=O)cc1" } },
    example { "OC(c1ccco1)c1ccccc1", from = { "c1ccoc1", "O=Cc1ccccc1" } },
    refuse { "OCc1cccs1" }, -- primary alcohol: from formaldehyde
}

disconnection "gilman-coupling" {
    about = "Corey-House coupling of a cuprate with a primary halide; SN2, primary only; vinyl geometry kept",
    target = "[$([c;$(c1ccccc1),$(c1ccco1),$(c1cccs1)]),$([CX3]=[CX3]);!$(C=[O,N,S]);!$([#6]-[O,N,S,F,Cl,Br,I]);!$([CX4]-[CX4]-[OX2,NX3,n,F,Cl,Br,I]);!$([CX4]-[CX2]#N):1]-!@[CX4;H2;!$(C(-c)-c):2]-[CX4;!$(C-[O,N,S,F,Cl,Br,I]);!$(C([#6])([#6])([#6])[#6]):3]",
    cut = { 2, 1 },
    acceptor = { 2, "alkyl" },
    donor = { 1, "organolithium" },
    when = function(m) return not m.molecule:has "[$([OH,SH]),$([#7;!H0]),$([CX3]=O),$(C#[N,C]),$([N+])]" end,
    conditions = "cuprate",
    recipe = "R2CuLi (RLi, CuI), THF, -30 to 0 °C; also: Br, OTs",
    yield = { 60, 90 },
    cautions = { "butyllithium", "copper(I) iodide" },
    source = "Corey, Posner, J. Am. Chem. Soc. 1967, 89, 3911; from memory",
    example { "CCCCCCc1ccc2c(c1)OCO2", from = { "[Li]c1ccc2c(c1)OCO2", "CCCCCCI" } },
    example { "CCCCCc1ccccc1", from = { "[Li]c1ccccc1", "CCCCCI" } },
    refuse { "CC(C)(C)c1ccccc1" }, -- tertiary halides do not couple
}
