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
    target = CARBANION .. ":1]-!@[CX4;H2:2]-[OX2H1:3]",
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
    also_attacks = { "free alcohol", "free acid", "aldehyde", "ketone", "acyl halide", "nitro",
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
