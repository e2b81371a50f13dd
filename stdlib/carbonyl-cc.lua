-- Carbon-carbon bonds made with enolates, ylides and cyanide.
-- Yields are typical ranges and sources stand from memory unless a source says otherwise.

pack {
    name = "carbonyl-cc",
    version = "0.1.0",
    licence = "CC0-1.0",
    about = "Carbon-carbon bonds made with enolates, ylides and cyanide",
    needs = { "synthons" },
}

-- Unions of two molecules of one compound, as pairs of what comes out and what goes in.
local ALDOL = {
    target = "[CX4;!H0;!$(C-O):1]-[CX4;H1;!R:2]([OX2H1:3])-!@[CX4;H1,H2;!$(C-O):4]-[CX3;H1:5]=[OX1:6]",
    from = "[C:1][C:2]=[O:3].[C:4][C:5]=[O:6]",
}
local ENAL = {
    target = "[CX4;!H0:1]-[CX3;!R:2]=[CX3;!R:3]-[CX3;$(C([#6])[#6]),H1:4]=[OX1:5]",
    from = "[C:1][C:2]=O.[C:3][C:4]=[O:5]",
}
local CLAISEN = {
    target = "[CX4;H1,H2,H3:1]-[CX3;!R:2](=[OX1:3])-[CX4;H1,H2:4]-[CX3:5](=[OX1:6])-[OX2:7]-[CX4;H2:8]-[CX4;H3:9]",
    from = "[C:1][C:2](=[O:3])OCC.[C:4][C:5](=[O:6])[O:7][C:8][C:9]",
}
local MCMURRY = {
    target = "[#6:1]-[CX3:2](-[#6:3])=!@[CX3:4](-[#6:5])-[#6:6]",
    from = "[#6:1][C:2](=O)[#6:3].[C:4](=O)([#6:5])[#6:6]",
}
local PINACOL = {
    target = "[c:1]-[CX4;!R:2]([OX2H1:3])-!@[CX4;!R:4]([OX2H1:5])-[c:6]",
    from = "[c:1][C:2]=[O:3].[C:4](=[O:5])[c:6]",
}

-- Whether taking the product apart gives the same compound twice; others would give four products.
local function joins_itself(m, rule)
    rule.rewrite = rule.rewrite or rewrite(rule.target .. ">>" .. rule.from)
    for _, pieces in ipairs(rule.rewrite:apply(m.molecule)) do
        if #pieces == 2 and pieces[1] == pieces[2] then return true end
    end
    return false
end

disconnection "aldol-directed" {
    about = "Directed aldol addition of a ketone to an aldehyde; less substituted enolate with LDA; Z enolate gives syn, E gives anti",
    rxno = "RXNO:0000016",
    target = "[#6;!$([#6]=[O,N,S]);!$([#6]#[N,C]):1]-[CX4;H1;!R:2]([OX2H1:3])-!@[CX4;!$(C-[OX2H1,F,Cl,Br,I]):4]-[CX3;$(C([#6])[#6]):5]=[OX1:6]",
    cut = { 2, 4 },
    acceptor = { 2, "hydroxyalkyl" },
    donor = { 4, "enolate" },
    conditions = "base-hindered",
    also_attacks = { "free alcohol", "free acid", "primary amine", "secondary amine", "aldehyde", "ketone",
        "alkyl halide", "acyl halide", "nitro", "terminal alkyne" },
    recipe = "LDA, THF, -78 °C, then the aldehyde; also: silyl enol ether with TiCl4 (Mukaiyama), Bu2BOTf",
    yield = { 60, 85 },
    cautions = { "butyllithium" },
    source = "Clayden, Greeves, Warren, Organic Chemistry; from memory",
    example { "CC(C)C(O)CC(=O)c1ccc(Br)cc1", from = { "CC(C)C=O", "CC(=O)c1ccc(Br)cc1" } },
    example { "CC(O)CC(=O)c1ccccc1", from = { "CC=O", "CC(=O)c1ccccc1" } },
    refuse { "CC(C)C(O)CC(=O)OC" }, -- an ester: Reformatsky or ester enolate
}

disconnection "aldol-self-aldehyde" {
    about = "Self aldol addition of an aldehyde; mixture of diastereomers",
    rxno = "RXNO:0000016",
    target = ALDOL.target,
    from = ALDOL.from,
    when = function(m) return joins_itself(m, ALDOL) end,
    conditions = "base-aq-mild",
    also_attacks = { "aldehyde", "ketone", "acyl halide", "alkyl halide" },
    recipe = "aq. NaOH or K2CO3, 0-10 °C, short; warm: the enal",
    yield = { 50, 75 },
    source = "Vogel's Textbook of Practical Organic Chemistry; from memory",
    example { "CCCC(O)C(CC)C=O", from = { "CCCC=O", "CCCC=O" } },
    example { "CC(O)CC=O", from = { "CC=O", "CC=O" } },
    refuse { "CC(C)C(O)CC=O" }, -- both halves are the same aldehyde
}

disconnection "ester-enolate-aldol" {
    about = "Aldol addition of an ester enolate; E(O) enolate gives anti (LDA, THF), Z(O) gives syn (HMPA)",
    rxno = "RXNO:0000016",
    target = "[#6;!$([#6]=[O,N,S]);!$([#6]#[N,C]):1]-[CX4;H0,H1;!R:2]([OX2H1:3])-!@[CX4;!$(C-[OX2H1,F,Cl,Br,I]):4]-[CX3:5](=[OX1:6])-[OX2:7]-[CX4:8]",
    cut = { 2, 4 },
    acceptor = { 2, "hydroxyalkyl" },
    donor = { 4, "enolate" },
    conditions = "base-hindered",
    also_attacks = { "free alcohol", "free acid", "primary amine", "secondary amine", "aldehyde", "ketone",
        "alkyl halide", "acyl halide", "nitro", "terminal alkyne" },
    recipe = "LDA or LHMDS, THF, -78 °C",
    yield = { 65, 90 },
    cautions = { "butyllithium" },
    source = "Carey, Sundberg, Advanced Organic Chemistry Part B; from memory",
    example { "CC(C)(C)OC(=O)CC(O)c1ccc2ccccc2c1", from = { "O=Cc1ccc2ccccc2c1", "CC(=O)OC(C)(C)C" } },
    example { "CCOC(=O)CC(O)c1ccccc1", from = { "O=Cc1ccccc1", "CC(=O)OCC" } },
    refuse { "CC(C)C(O)CC(N)=O" }, -- a primary amide, not an ester
}

disconnection "aldol-formaldehyde" {
    about = "Hydroxymethylation of a ketone or aldehyde; several CH2OH may enter; more substituted side of " ..
        "a ketone (thermodynamic)",
    rxno = "RXNO:0000016",
    target = "[OX2H1:1]-[CX4;H2:2]-[CX4;!$(C-[O,N,S]);!$([CX4](C=O)C(=O)[O,N]):3]-[CX3;$(C([#6])[#6]),H1:4]=[OX1:5]",
    cut = { 2, 3 },
    acceptor = { 2, "hydroxyalkyl" },
    donor = { 3, "enolate" },
    conditions = "base-aq-mild",
    also_attacks = { "aldehyde", "ketone", "primary amine", "secondary amine" },
    recipe = "aq. CH2O, K2CO3 or NaOH cat., 0-25 °C",
    yield = { 40, 75 },
    cautions = { "formaldehyde" },
    source = "Vogel's Textbook of Practical Organic Chemistry; from memory",
    example { "CC1(CO)CCN(C(=O)OCC)CC1=O", from = { "C=O", "CC1CCN(C(=O)OCC)CC1=O" } },
    example { "CC(C)(CO)C=O", from = { "C=O", "CC(C)C=O" } },
    refuse { "COC(=O)CCO" }, -- an ester does not enolise under these conditions
    refuse { "OCC(O)C(=O)CO" }, -- a sugar
}

disconnection "arylidene-cycloalkanone" {
    about = "Arylidenation of a cyclic ketone; E; the bis-arylidene compound is the rival with a " ..
        "symmetrical ketone",
    rxno = "RXNO:0000595",
    target = "[c:1]-[CX3;H1;!R:2]=[CX3;R:3]-[CX3;R;$(C([#6])[#6]):4]=[OX1:5]",
    cut = { 2, 3 },
    acceptor = { 2, "alkylidene" },
    donor = { 3, "enolate" },
    conditions = "base-aq-mild",
    also_attacks = { "aldehyde", "ketone", "acyl halide" },
    recipe = "KOH, EtOH/H2O, rt, excess of ketone",
    yield = { 50, 80 },
    source = "Vogel's Textbook of Practical Organic Chemistry; from memory",
    example { "O=C1CCCC/C1=C\\c1ccc(Cl)cc1", from = { "O=Cc1ccc(Cl)cc1", "O=C1CCCCC1" } },
    example { "O=C1CCCC/C1=C\\c1ccccc1", from = { "O=Cc1ccccc1", "O=C1CCCCC1" } },
    refuse { "O=C1OC(c2ccccc2)=NC1=Cc1ccccc1" }, -- an azlactone: no ketone
}

disconnection "aldol-condensation-self" {
    about = "Self condensation of a ketone or aldehyde; E alkene",
    rxno = "RXNO:0000017",
    target = ENAL.target,
    from = ENAL.from,
    when = function(m) return joins_itself(m, ENAL) end,
    conditions = "base-aq-strong",
    also_attacks = { "aldehyde", "ketone", "acyl halide", "alkyl halide" },
    recipe = "aq. NaOH, 80 °C or acid, heat",
    yield = { 60, 85 },
    source = "Vogel's Textbook of Practical Organic Chemistry; from memory",
    example { "CCCC/C=C(\\CCC)C=O", from = { "CCCCC=O", "CCCCC=O" } },
    example { "CC/C=C(\\C)C=O", from = { "CCC=O", "CCC=O" } },
    example { "CC(C)=CC(C)=O", from = { "CC(C)=O", "CC(C)=O" } },
    refuse { "CCC=CC(C)=O" }, -- both halves are the same compound
}

disconnection "claisen-ester" {
    about = "Claisen condensation; one β-keto ester only where the ester is alone; the product must keep an " ..
        "acidic H",
    rxno = "RXNO:0000043",
    target = CLAISEN.target,
    from = CLAISEN.from,
    when = function(m) return joins_itself(m, CLAISEN) end,
    conditions = "alkoxide",
    also_attacks = { "free acid", "aldehyde", "alkyl halide", "acyl halide", "ketone" },
    recipe = "NaOEt (stoichiometric), EtOH or neat, heat, then acid; alkoxide of the same alcohol as in the ester",
    yield = { 55, 80 },
    cautions = { "sodium ethoxide" },
    source = "Clayden, Greeves, Warren, Organic Chemistry; from memory",
    example { "CCC(=O)C(C)C(=O)OCC", from = { "CCC(=O)OCC", "CCC(=O)OCC" } },
    example { "CCOC(=O)CC(C)=O", from = { "CCOC(C)=O", "CCOC(C)=O" } },
    refuse { "CCCC(=O)CC(=O)OCC" }, -- both halves are the same ester
}

disconnection "claisen-crossed" {
    about = "Crossed Claisen condensation with a non-enolisable ester; the enolisable ester is the donor",
    rxno = "RXNO:0000043",
    target = "[c:1]-[CX3;!R:2](=[OX1:3])-!@[CX4;H1,H2:4]-[CX3:5](=[OX1:6])-[OX2:7]-[CX4:8]",
    cut = { 2, 4 },
    acceptor = { 2, "acyl-ethyl-ester" },
    donor = { 4, "enolate" },
    conditions = "base-hindered",
    also_attacks = { "free acid", "aldehyde", "alkyl halide", "acyl halide", "ketone" },
    recipe = "NaH or LHMDS, THF, 0 °C to reflux; the aryl ester in excess",
    yield = { 60, 85 },
    cautions = { "sodium hydride" },
    source = "Carey, Sundberg, Advanced Organic Chemistry Part B; from memory",
    example { "COc1ccc(C(=O)CC(=O)OCC)cc1", from = { "COc1ccc(C(=O)OCC)cc1", "CCOC(C)=O" } },
    example { "CCOC(=O)CC(=O)c1ccccc1", from = { "CCOC(=O)c1ccccc1", "CCOC(C)=O" } },
    refuse { "CCC(=O)CC(=O)OCC" }, -- both esters enolise: four products
}

disconnection "ketone-carboethoxylation" {
    about = "Acylation of a ketone by diethyl carbonate; less substituted α carbon",
    target = "[#6:1]-[CX3:2](=[OX1:3])-[CX4;H1,H2:4]-!@[CX3:5](=[OX1:6])-[OX2:7]-[CX4;H2:8]-[CX4;H3:9]",
    cut = { 5, 4 },
    acceptor = { 5, "acyl-ethyl-ester" },
    donor = { 4, "enolate" },
    conditions = "base-hindered",
    also_attacks = { "free acid", "aldehyde", "alkyl halide", "acyl halide" },
    recipe = "NaH, toluene or THF, reflux; also: dimethyl carbonate, Mander's reagent (methyl cyanoformate) with LDA",
    yield = { 70, 90 },
    cautions = { "sodium hydride" },
    source = "Vogel's Textbook of Practical Organic Chemistry; from memory",
    example { "CCOC(=O)C1CCc2cc(OC)ccc2C1=O", from = { "O=C1CCCc2cc(OC)ccc21", "CCOC(=O)OCC" } },
    example { "CCOC(=O)C1CCCCC1=O", from = { "O=C1CCCCC1", "CCOC(=O)OCC" } },
    refuse { "CCOC(=O)C(C)(C)C(C)=O" }, -- no H left between the carbonyl groups to drive the reaction
}

disconnection "diketone-claisen" {
    about = "1,3-Diketone from a ketone and an ester; acylation at the methyl side of a methyl ketone",
    rxno = "RXNO:0000043",
    target = "[#6;$(c),$([CX4](F)(F)F):1]-[CX3;!R:2](=[OX1:3])-!@[CX4;H1,H2:4]-[CX3:5](=[OX1:6])-[#6:7]",
    cut = { 2, 4 },
    acceptor = { 2, "acyl-ethyl-ester" },
    donor = { 4, "enolate" },
    conditions = "alkoxide",
    also_attacks = { "free acid", "aldehyde", "alkyl halide", "acyl halide" },
    recipe = "NaOMe, MeOH or MTBE, rt to reflux; also: NaH, LHMDS",
    yield = { 75, 95 },
    cautions = { "sodium methoxide" },
    source = "Carey, Sundberg, Advanced Organic Chemistry Part B; from memory",
    example { "Cc1ccc(C(=O)CC(=O)C(F)(F)F)cc1", from = { "CCOC(=O)C(F)(F)F", "CC(=O)c1ccc(C)cc1" } },
    example { "O=C(CC(=O)c1ccccc1)c1ccccc1", from = { "CCOC(=O)c1ccccc1", "CC(=O)c1ccccc1" } },
    refuse { "CC(=O)C(C)(C)C(C)=O" }, -- no H between the carbonyl groups
}

disconnection "dieckmann" {
    about = "Dieckmann condensation; five- and six-membered rings; with unequal ends the one with two α H " ..
        "is the nucleophile",
    rxno = "RXNO:0000065",
    target = "[CX3;r5,r6:1](=[OX1:2])-;@[CX4;H1;r5,r6:3]-!@[CX3:4](=[OX1:5])-[OX2:6]-[CX4;H2:7]-[CX4;H3:8]",
    from = "([C:1](=[O:2])OCC.[C:3][C:4](=[O:5])[O:6][C:7][C:8])",
    conditions = "alkoxide",
    also_attacks = { "free acid", "aldehyde", "alkyl halide", "acyl halide", "ketone" },
    recipe = "NaOEt or NaH, toluene, reflux; also: KOtBu, THF, dimethyl ester with NaOMe",
    yield = { 60, 85 },
    cautions = { "sodium hydride" },
    source = "Clayden, Greeves, Warren, Organic Chemistry; from memory",
    example { "CCOC(=O)C1CN(Cc2ccccc2)CCC1=O", from = { "CCOC(=O)CCN(CCC(=O)OCC)Cc1ccccc1" } },
    example { "CCOC(=O)C1CCCC1=O", from = { "CCOC(=O)CCCCC(=O)OCC" } },
    refuse { "CCOC(=O)C1CCCCCCC1=O" }, -- an eight-membered ring needs high dilution and gives little
}

disconnection "nitroaldol-condensation" {
    about = "Nitroalkene from an aromatic aldehyde; E alkene",
    target = "[c:1]/?[CX3;H1;!R:2]=[CX3;!R:3]/?[NX3+:4](=[OX1:5])-[O-:6]",
    cut = { 2, 3 },
    acceptor = { 2, "alkylidene" },
    donor = { 3, "nitronate" },
    conditions = "amine-rt",
    also_attacks = { "other aldehyde", "primary amine" },
    recipe = "NH4OAc, AcOH, reflux; or nitroalkane solvent; also: NaOH, MeOH, then acid",
    yield = { 65, 90 },
    cautions = { "nitromethane" },
    source = "Vogel's Textbook of Practical Organic Chemistry; from memory",
    example { "COc1ccc(/C=C/[N+](=O)[O-])cc1OC", from = { "COc1ccc(C=O)cc1OC", "C[N+](=O)[O-]" } },
    example { "[O-][N+](=O)/C=C/c1ccccc1", from = { "O=Cc1ccccc1", "C[N+](=O)[O-]" } },
    refuse { "O=[N+]([O-])/C=C\\c1ccccc1" }, -- the Z nitroalkene is not formed
}

disconnection "michael-nitroalkane" {
    about = "Michael addition of a nitroalkane; 1,4-addition; nitromethane can add two or three times",
    rxno = "RXNO:0000241",
    target = "[CX4;$(C[NX3+](=O)[O-]):1]-!@[CX4:2]-[CX4;H1,H2:3]-[#6;$([CX3](=O)([#6])[#6]),$([CX3](=O)[OX2][#6]),$([CX3](=O)[NX3]),$([CX2]#N):4]",
    from = "[C:1].[C:2]=[C:3][#6:4]",
    conditions = "amine-rt",
    also_attacks = { "alkyl halide", "aldehyde", "acyl halide", "other enone" },
    recipe = "DBU or tetramethylguanidine cat., MeCN, rt; also: KF, Triton B",
    yield = { 60, 90 },
    cautions = { "nitromethane" },
    source = "Carey, Sundberg, Advanced Organic Chemistry Part B; from memory",
    example { "COC(=O)CCC(C)(C)[N+](=O)[O-]", from = { "CC(C)[N+](=O)[O-]", "C=CC(=O)OC" } },
    example { "CC(=O)CCC(C)(C)[N+](=O)[O-]", from = { "CC(C)[N+](=O)[O-]", "C=CC(C)=O" } },
    refuse { "COC(=O)CC(C)[N+](=O)[O-]" }, -- nitro group in the β position: not this pattern
}

disconnection "michael-nitroalkene" {
    about = "Michael addition to a nitroalkene; syn with enamines (pyrrolidine catalysts)",
    rxno = "RXNO:0000241",
    target = "[CX4;H0,H1;$(C[CX3](=O)[#6,O,#1]):1]-!@[CX4;H1:2]-[CX4;H1,H2:3]-[NX3+:4](=[OX1:5])-[O-:6]",
    from = "[C:1].[C:2]=[C:3][N+:4](=[O:5])[O-:6]",
    conditions = "amine-rt",
    also_attacks = { "aldehyde", "acyl halide", "thiol", "primary amine" },
    recipe = "pyrrolidine or proline amide cat.; malonates: Et3N, THF, rt",
    yield = { 65, 95 },
    source = "Carey, Sundberg, Advanced Organic Chemistry Part B; from memory",
    example { "O=C1CCCCC1C(C[N+](=O)[O-])c1ccccc1", from = { "O=C1CCCCC1", "O=[N+]([O-])C=Cc1ccccc1" } },
    example { "CCOC(=O)C(C(=O)OCC)C(C[N+](=O)[O-])c1ccccc1", from = { "CCOC(=O)CC(=O)OCC", "O=[N+]([O-])C=Cc1ccccc1" } },
    refuse { "O=[N+]([O-])CCCc1ccccc1" }, -- the donor carbon has no carbonyl group
}

disconnection "robinson" {
    about = "Robinson annulation; at the more acidic α carbon; new ring carbon quaternary with " ..
        "2-alkyl-1,3-diones; (S)-proline gives (S)",
    rxno = "RXNO:0000380",
    target = "[CX3:1]1=[CX3;H1:2]-[CX3:3](=[OX1:4])-[CX4;H1,H2:5]-[CX4;H2:6]-[CX4;H0,H1:7]-1",
    from = "[C:1](=O)[C:7].[C:2][C:3](=[O:4])[C:5]=[C:6]",
    when = function(m) return not m.molecule:has "[OX2;r3]" end, -- a base opens the epoxide of its ketone
    conditions = "alkoxide",
    also_attacks = { "aldehyde", "alkyl halide", "acyl halide", "thiol", "primary amine" },
    recipe = "KOH, MeOH, reflux, or pyrrolidine, AcOH; Mannich base as a masked enone",
    yield = { 50, 80 },
    cautions = { "methyl vinyl ketone" },
    source = "Clayden, Greeves, Warren, Organic Chemistry; from memory",
    example { "CC12CCC(=O)C=C1CCCC2=O", from = { "CC1C(=O)CCCC1=O", "C=CC(C)=O" } },
    example { "CC12CCCCC1=CC(=O)CC2", from = { "CC1CCCCC1=O", "C=CC(C)=O" } },
    refuse { "CC1=CC(=O)CCC1" }, -- the donor would be acetone itself: no selectivity
}

disconnection "stobbe" {
    about = "Stobbe condensation; E/Z mixture; the free acid is the carboxyl on the CH2",
    target = "[CX3;!$(C=O):1]=!@[CX3:2](-[CX3:3](=[OX1:4])-[OX2:5]-[CX4:6])-[CX4;H2:7]-[CX3:8](=[OX1:9])-[OX2H1:10]",
    from = "[C:1]=O.[C:2]([C:3](=[O:4])[O:5][C:6])[C:7][C:8](=[O:9])[O:10]CC",
    conditions = "alkoxide",
    also_attacks = { "aldehyde", "alkyl halide", "acyl halide" },
    recipe = "KOtBu, tBuOH, reflux; also: NaH",
    yield = { 60, 90 },
    cautions = { "potassium tert-butoxide" },
    source = "Johnson, Daub, Org. React. 1951, 6, 1; from memory",
    example { "CCOC(=O)C(CC(=O)O)=C(c1ccccc1)c1ccccc1", from = { "O=C(c1ccccc1)c1ccccc1", "CCOC(=O)CCC(=O)OCC" } },
    example { "CCOC(=O)C(CC(=O)O)=C1CCCCC1", from = { "O=C1CCCCC1", "CCOC(=O)CCC(=O)OCC" } },
    refuse { "CCOC(=O)C(CC(=O)OCC)=C(C)C" }, -- a diester: the reaction gives the half ester
}

disconnection "perkin-arylacetic" {
    about = "Perkin condensation of an arylacetic acid; the two aryl groups cis",
    rxno = "RXNO:0000003",
    target = "[c:1]-[CX3;H1:2]=[CX3:3](-[c:4])-[CX3:5](=[OX1:6])-[OX2H1:7]",
    cut = { 2, 3 },
    acceptor = { 2, "alkylidene" },
    donor = { 3, "enolate" },
    conditions = "acylation",
    also_attacks = { "free alcohol", "phenol", "primary amine", "secondary amine" },
    recipe = "Ac2O, Et3N, reflux",
    yield = { 45, 75 },
    cautions = { "acetic anhydride" },
    source = "Vogel's Textbook of Practical Organic Chemistry; from memory",
    example { "O=C(O)/C(=C/c1ccccc1)c1ccc(OC)cc1", from = { "O=Cc1ccccc1", "COc1ccc(CC(=O)O)cc1" } },
    example { "O=C(O)/C(=C/c1ccccc1)c1ccccc1", from = { "O=Cc1ccccc1", "O=C(O)Cc1ccccc1" } },
    refuse { "O=C(O)C(=Cc1ccccc1)C(=O)O" }, -- a malonic acid derivative: Knoevenagel
}

disconnection "stetter" {
    about = "Stetter reaction; 1,4-addition of the acyl anion equivalent",
    target = "[#6;!$([#6]=O);!$([#6]-[O,N,F,Cl,Br,I]):1]-[CX3;!R:2](=[OX1:3])-!@[CX4:4]-[CX4;H1,H2:5]-[#6;$([CX3](=O)([#6])[#6]),$([CX3](=O)[OX2][#6]),$([CX3](=O)[NX3]),$([CX2]#N):6]",
    from = "[#6:1][C:2]=[O:3].[C:4]=[C:5][#6:6]",
    conditions = "amine-heat",
    also_attacks = { "other aldehyde", "alkyl halide" },
    recipe = "thiazolium salt (20 mol%), Et3N, EtOH or dioxane, 80 °C",
    yield = { 55, 85 },
    cautions = { "methyl vinyl ketone" },
    source = "Stetter, Angew. Chem. Int. Ed. 1976, 15, 639; from memory",
    example { "CC(=O)CCC(=O)c1ccc(F)cc1", from = { "O=Cc1ccc(F)cc1", "C=CC(C)=O" } },
    example { "CC(=O)CCC(=O)c1ccco1", from = { "O=Cc1ccco1", "C=CC(C)=O" } },
    refuse { "COC(=O)CCC(=O)OC" }, -- an ester is not made from an aldehyde
}

disconnection "acyloin-ring" {
    about = "Acyloin condensation of a diester; good also for medium and large rings",
    rxno = "RXNO:0000460",
    target = "[CX4;H1;R;$(C-[CX4]);!r3;!r4:1]([OX2H1:2])-;@[CX3;R;!r3;!r4;$(C([CX4])[CX4]):3]=[OX1:4]",
    from = "([C:1](=[O:2])OCC.[C:3](=[O:4])OCC)",
    conditions = "birch",
    also_attacks = { "free alcohol", "aldehyde", "ketone", "nitro", "alkyl halide", "aryl halide", "enone" },
    recipe = "Na, TMSCl, toluene, reflux, then acid",
    yield = { 55, 90 },
    cautions = { "sodium metal", "chlorotrimethylsilane" },
    source = "Kürti, Czakó, Strategic Applications of Named Reactions in Organic Synthesis; from memory",
    example { "O=C1CCCCCCCCC1O", from = { "CCOC(=O)CCCCCCCCC(=O)OCC" } },
    example { "O=C1CCCCC1O", from = { "CCOC(=O)CCCCC(=O)OCC" } },
    refuse { "CC(O)C(C)=O" }, -- open chain: this rule closes rings
}

disconnection "baylis-hillman" {
    about = "Baylis-Hillman reaction; α carbon of the acrylate",
    rxno = "RXNO:0000076",
    target = "[#6;!$([#6]=[O,N,S]);!$([#6]#[N,C]):1]-[CX4;H1;!R:2]([OX2H1:3])-!@[CX3;!R:4](=[CX3;H2:5])-[#6;$([CX3](=O)([#6])[#6]),$([CX3](=O)[OX2][#6]),$([CX3](=O)[NX3]),$([CX2]#N):6]",
    cut = { 2, 4 },
    acceptor = { 2, "hydroxyalkyl" },
    donor = { 4, "alkene" },
    conditions = "amine-rt",
    also_attacks = { "other aldehyde", "alkyl halide", "thiol", "primary amine" },
    recipe = "DABCO, neat or aq. dioxane, rt, days; also: 3-quinuclidinol",
    yield = { 55, 90 },
    cautions = { "methyl acrylate" },
    source = "Kürti, Czakó, Strategic Applications of Named Reactions in Organic Synthesis; from memory",
    example { "C=C(C(=O)OC)C(O)c1ccc([N+](=O)[O-])cc1", from = { "O=Cc1ccc([N+](=O)[O-])cc1", "C=CC(=O)OC" } },
    example { "C=C(C(=O)OC)C(O)c1ccccc1", from = { "O=Cc1ccccc1", "C=CC(=O)OC" } },
    refuse { "C=C(C)C(O)c1ccccc1" }, -- the alkene has no electron-withdrawing group
}

disconnection "ester-enolate-alkylation" {
    about = "Alkylation of an ester enolate; less hindered face",
    target = "[CX4:1]-[OX2:2]-[CX3:3](=[OX1:4])-[CX4;H0,H1;!$(C([CX3]=O)[CX3]=O);!$(C(C=O)[CX2]#N);!$(C-[N+](=O)[O-]);!$(C-[OX2H1]);!$(C-[NX3;H1,H2]):5]-!@[CX4;H2,H3;!$(C-[O,N,S,F,Cl,Br,I]);!$([CX4][CX4]([CX4])([CX4])[CX4]):6]",
    cut = { 6, 5 },
    acceptor = { 6, "alkyl" },
    donor = { 5, "enolate" },
    conditions = "base-hindered",
    also_attacks = { "free alcohol", "free acid", "primary amine", "secondary amine", "aldehyde", "ketone",
        "alkyl halide", "acyl halide", "nitro", "terminal alkyne" },
    recipe = "LDA or LHMDS, THF, -78 °C to rt; also: I (best), OTf",
    yield = { 65, 90 },
    cautions = { "butyllithium" },
    source = "Carey, Sundberg, Advanced Organic Chemistry Part B; from memory",
    example { "COC(=O)C1(CC=C)CCN(C(=O)OC(C)(C)C)CC1", from = { "COC(=O)C1CCN(C(=O)OC(C)(C)C)CC1", "C=CCBr" } },
    example { "CCOC(=O)C(C)Cc1ccccc1", from = { "CCOC(=O)CC", "BrCc1ccccc1" } },
    refuse { "COC(=O)CC(C)C" }, -- a secondary halide (and acetate gives over-alkylation)
}

disconnection "aryl-ketone-alkylation" {
    about = "α-Alkylation of an aryl ketone; one side only can enolise; dialkylation is the rival",
    target = "[c:1]-[CX3:2](=[OX1:3])-[CX4;H0,H1;!$(C([CX3]=O)[CX3]=O):4]-!@[CX4;H2,H3;!$(C-[O,N,S,F,Cl,Br,I]);!$([CX4][CX4]([CX4])([CX4])[CX4]):5]",
    cut = { 5, 4 },
    acceptor = { 5, "alkyl" },
    donor = { 4, "enolate" },
    conditions = "base-hindered",
    also_attacks = { "free alcohol", "free acid", "primary amine", "secondary amine", "aldehyde", "ketone",
        "alkyl halide", "acyl halide", "nitro", "terminal alkyne" },
    recipe = "LDA or LHMDS, THF, -78 to 0 °C; also: I, OTs",
    yield = { 55, 85 },
    cautions = { "butyllithium" },
    source = "Carey, Sundberg, Advanced Organic Chemistry Part B; from memory",
    example { "C=CCC1CCc2cc(OC)ccc2C1=O", from = { "COc1ccc2c(c1)CCCC2=O", "C=CCBr" } },
    example { "O=C(C(C)Cc1ccccc1)c1ccccc1", from = { "CCC(=O)c1ccccc1", "BrCc1ccccc1" } },
    refuse { "CCCCC(=O)CC=C" }, -- two enolates of like stability: the position is not defined
}

disconnection "arylacetonitrile-alkylation" {
    about = "Alkylation of an arylacetonitrile; dialkylation is the rival; two halides in one molecule " ..
        "close a ring",
    target = "[NX1:1]#[CX2:2]-[CX4;H0,H1;$(C-c):3]-!@[CX4;H2,H3;!$(C-[O,N,S,F,Cl,Br,I]);!$([CX4][CX4]([CX4])([CX4])[CX4]):4]",
    cut = { 4, 3 },
    acceptor = { 4, "alkyl" },
    donor = { 3, "stabilised-carbanion" },
    conditions = "base-aq-strong",
    also_attacks = { "alkyl halide", "aldehyde", "acyl halide", "epoxide", "ester" },
    recipe = "NaOH 50 %, Bu4NBr, toluene; also: NaH, DMSO; Cl",
    yield = { 60, 90 },
    cautions = { "sodium hydride" },
    source = "Carey, Sundberg, Advanced Organic Chemistry Part B; from memory",
    example { "N#CC(CCCN1CCCCC1)c1ccccc1", from = { "N#CCc1ccccc1", "BrCCCN1CCCCC1" } },
    example { "CCC(C#N)c1ccccc1", from = { "N#CCc1ccccc1", "CCBr" } },
    refuse { "CCCCC#N" }, -- without an aryl group LDA is needed
}

disconnection "enamine-alkylation" {
    about = "Stork enamine alkylation; less substituted α carbon, monoalkylation",
    target = "[OX1:1]=[CX3;R;$(C([#6])[#6]):2]-[CX4;H1;R;!$(C~[CX4]-[OX2,NX3]):3]-!@[CX4;H2;$(C-[c,$([CX3]=C),$(C(=O)[O,#6]),$(C#C)]):4]",
    cut = { 4, 3 },
    acceptor = { 4, "alkyl" },
    donor = { 3, "enolate" },
    when = function(m) return not m.molecule:has "[CX3](=[OX1])[CX4;H1,H2][CX4][OX2,NX3]" end,
    conditions = "amine-heat",
    also_attacks = { "aldehyde", "acyl halide", "primary amine", "other alkyl halide" },
    recipe = "pyrrolidine, toluene, Dean-Stark; then halide, MeCN or dioxane, reflux; aq. acid",
    yield = { 50, 75 },
    cautions = { "pyrrolidine" },
    source = "Stork et al., J. Am. Chem. Soc. 1963, 85, 207; from memory",
    example { "CCOC(=O)CC1CCCCC1=O", from = { "O=C1CCCCC1", "CCOC(=O)CBr" } },
    example { "C=CCC1CCCCC1=O", from = { "O=C1CCCCC1", "C=CCBr" } },
    refuse { "CCCCC1CCCCC1=O" }, -- plain alkyl halides alkylate the nitrogen
}

disconnection "enamine-acylation" {
    about = "Stork enamine acylation; less substituted α carbon",
    target = "[OX1:1]=[CX3;R;$(C([#6])[#6]):2]-[CX4;H1;R:3]-!@[CX3;!R:4](=[OX1:5])-[#6;!$([#6]=O):6]",
    cut = { 4, 3 },
    acceptor = { 4, "acyl" },
    donor = { 3, "enolate" },
    conditions = "acylation",
    also_attacks = { "free alcohol", "primary amine", "secondary amine", "aldehyde" },
    recipe = "morpholine enamine, Et3N, CHCl3 or toluene, rt; aq. HCl",
    yield = { 55, 80 },
    cautions = { "morpholine", "chloroform" },
    source = "Vogel's Textbook of Practical Organic Chemistry; from memory",
    example { "CCCCCC(=O)C1CCCCC1=O", from = { "O=C1CCCCC1", "CCCCCC(=O)Cl" } },
    example { "O=C1CCCCC1C(=O)c1ccccc1", from = { "O=C1CCCCC1", "O=C(Cl)c1ccccc1" } },
    refuse { "CCOC(=O)C1CCCCC1=O" }, -- an ester: diethyl carbonate instead
}

disconnection "dithiane-alkylation" {
    about = "Alkylation of a 2-substituted 1,3-dithiane (Corey-Seebach); SN2; acyl anion equivalent " ..
        "(umpolung, d1)",
    rxno = "RXNO:0000662",
    target = "[#6:1]-[CX4;H0:2]1(-!@[CX4;H2,H3;!$(C-[O,N,S,F,Cl,Br,I]);!$([CX4][CX4]([CX4])([CX4])[CX4]):3])-[SX2:4]-[CX4;H2:5]-[CX4;H2:6]-[CX4;H2:7]-[SX2:8]-1",
    cut = { 3, 2 },
    acceptor = { 3, "alkyl" },
    donor = { 2, "stabilised-carbanion" },
    conditions = "organolithium",
    also_attacks = { "free alcohol", "free acid", "primary amine", "secondary amine", "aldehyde", "ketone",
        "alkyl halide", "acyl halide", "nitro", "terminal alkyne", "ester", "nitrile" },
    recipe = "BuLi, THF, -30 °C, then halide; also: I, OTs, epoxide",
    yield = { 65, 90 },
    cautions = { "butyllithium", "1,3-propanedithiol (stench)" },
    source = "Corey, Seebach, Angew. Chem. Int. Ed. 1965, 4, 1075; from memory",
    example { "COc1ccc(C2(CCC3OCCO3)SCCCS2)cc1", from = { "COc1ccc(C2SCCCS2)cc1", "BrCCC1OCCO1" } },
    example { "CCCCC1(c2ccccc2)SCCCS1", from = { "C1CSC(SC1)c1ccccc1", "CCCCBr" } },
    refuse { "CC(C)(C)C1(c2ccccc2)SCCCS1" }, -- a tertiary halide does not react
}

disconnection "strecker" {
    about = "Strecker reaction; racemic",
    rxno = "RXNO:0000207",
    target = "[CX4;!$(C(-[CX2]#N)-[CX2]#N):1](-[NX3;+0;!$(N-[C,S]=[O,S]);!$(N-c:n):2])-[CX2;+0:3]#[NX1:4]",
    from = "[C:1]=O.[N:2].[Na+].[C-:3]#[N:4]",
    conditions = "cyanide",
    also_attacks = { "other aldehyde", "acyl halide", "alkyl halide" },
    recipe = "amine (NH4Cl for NH2), NaCN, AcOH, aq. MeOH, rt; also: TMSCN",
    yield = { 60, 90 },
    cautions = { "sodium cyanide", "hydrogen cyanide" },
    source = "Clayden, Greeves, Warren, Organic Chemistry; from memory",
    example { "N#CC(NCc1ccccc1)c1ccc(Cl)cc1", from = { "O=Cc1ccc(Cl)cc1", "NCc1ccccc1", "[Na+].[C-]#N" } },
    example { "NC(C#N)c1ccccc1", from = { "O=Cc1ccccc1", "N", "[Na+].[C-]#N" } },
    refuse { "N#CCCN1CCCC1" }, -- β-aminonitrile: aza-Michael addition to acrylonitrile
}

interconversion "krapcho" {
    about = "Krapcho decarboxylation; one ester is lost, the other stays",
    rxno = "RXNO:0000507",
    target = "[CX4;$([CH3]),$([CH2][CH3]),R:1]-[OX2:2]-[CX3:3](=[OX1:4])-[CX4;H1,H2;!$([C@H](*)(*)*);!$(C-[CX4]-O);!$(C-[O,S]):5]-[#6;!$([#6]=O):6]",
    from = "[C:1][O:2][C:3](=[O:4])[C:5]([#6:6])C(=O)OC",
    conditions = "heat-200",
    also_attacks = { "alkyl halide", "tertiary alcohol" },
    recipe = "NaCl or LiCl, wet DMSO, 150-180 °C; methyl esters best",
    yield = { 70, 95 },
    cautions = { "dimethyl sulfoxide at high temperature" },
    source = "Kürti, Czakó, Strategic Applications of Named Reactions in Organic Synthesis; from memory",
    example { "COC(=O)CC1CCCC(=O)C1", from = { "COC(=O)C(C1CCCC(=O)C1)C(=O)OC" } },
    example { "COC(=O)CCCC", from = { "COC(=O)C(CCC)C(=O)OC" } },
    refuse { "COC(=O)C(C)(C)C" }, -- no H left where the second ester stood
}

disconnection "wittig-vinyl" {
    about = "Wittig methylenation of an aldehyde; terminal alkene",
    rxno = "RXNO:0000091",
    target = "[#6;!$([#6]=[O,N,S]);!$([#6]#[N,C]);!$([CH2][#7,#8,#16,F,Cl,Br,I]):1]-[CX3;H1:2]=[CX3;H2:4]",
    cut = { 2, 4 },
    acceptor = { 2, "alkylidene" },
    donor = { 4, "phosphonium" },
    conditions = "ylide",
    also_attacks = { "free acid", "other aldehyde", "alkyl halide", "acyl halide", "ketone" },
    recipe = "MePPh3Br, BuLi, KOtBu or K2CO3 (dioxane), THF, 0 °C to rt",
    yield = { 65, 90 },
    cautions = { "butyllithium" },
    source = "Clayden, Greeves, Warren, Organic Chemistry; from memory",
    example { "C=Cc1ccc(C(=O)OC)cc1", from = { "COC(=O)c1ccc(C=O)cc1", "[Br-].C[P+](c1ccccc1)(c1ccccc1)c1ccccc1" } },
    example { "C=Cc1ccccc1", from = { "O=Cc1ccccc1", "[Br-].C[P+](c1ccccc1)(c1ccccc1)c1ccccc1" } },
    refuse { "C=COC(C)=O" }, -- an enol ester: no aldehyde stands for it
    refuse { "C=CCOc1ccccc1" }, -- an allyl ether comes from allyl bromide
}

disconnection "still-gennari" {
    about = "Still-Gennari olefination; Z alkene",
    rxno = "RXNO:0000478",
    target = "[#6:1]/[CX3;H1;!R:2]=[CX3;H1;!R:3]\\[CX3:4](=[OX1:5])-[OX2:6]-[CX4:7]",
    from = "[#6:1][C:2]=O.[C:3]([C:4](=[O:5])[O:6][C:7])P(=O)(OCC(F)(F)F)OCC(F)(F)F",
    conditions = "ylide",
    also_attacks = { "free acid", "other aldehyde", "alkyl halide", "acyl halide" },
    recipe = "KHMDS, 18-crown-6, THF, -78 °C",
    yield = { 70, 90 },
    source = "Still, Gennari, Tetrahedron Lett. 1983, 24, 4405; from memory",
    example { "COC(=O)/C=C\\CCCOCc1ccccc1", from = { "O=CCCCOCc1ccccc1", "COC(=O)CP(=O)(OCC(F)(F)F)OCC(F)(F)F" } },
    example { "COC(=O)/C=C\\c1ccccc1", from = { "O=Cc1ccccc1", "COC(=O)CP(=O)(OCC(F)(F)F)OCC(F)(F)F" } },
    refuse { "COC(=O)/C=C/CC" }, -- the E ester: Horner-Wadsworth-Emmons
}

disconnection "peterson-methylenation" {
    about = "Peterson olefination (methylene); base gives syn elimination, acid gives anti elimination",
    rxno = "RXNO:0000080",
    target = "[#6;!$([#6]=[O,N,S]);!$([#6]#[N,C]):1]-[CX3;H0:2](-[#6;!$([#6]=[O,N,S]);!$([#6]#[N,C]):3])=[CX3;H2:4]",
    from = "[#6:1][C:2](=O)[#6:3].C[Si](C)(C)[C:4][Mg]Cl",
    conditions = "grignard",
    also_attacks = { "free alcohol", "free acid", "primary amine", "secondary amine", "aldehyde", "ketone",
        "ester", "nitrile", "acyl halide", "epoxide", "nitro", "terminal alkyne" },
    recipe = "Me3SiCH2MgCl, Et2O, then KH or aq. acid; good for hindered or enolisable ketones",
    yield = { 60, 85 },
    cautions = { "magnesium alkyl halide", "diethyl ether" },
    source = "Carey, Sundberg, Advanced Organic Chemistry Part B; from memory",
    example { "C=C1CC2CCC1C2", from = { "O=C1CC2CCC1C2", "C[Si](C)(C)C[Mg]Cl" } },
    example { "C=C1CCCCC1", from = { "O=C1CCCCC1", "C[Si](C)(C)C[Mg]Cl" } },
    refuse { "C=Cc1ccccc1" }, -- a monosubstituted alkene: use the aldehyde and a ylide
}

disconnection "julia-kocienski" {
    about = "Julia-Kocienski olefination; E alkene (KHMDS, DME)",
    rxno = "RXNO:0000304",
    target = "[#6:1]/[CX3;H1;!R:2]=[CX3;H1;!R:3]/[CX4;!$(C-[O,N,S,F,Cl,Br,I]):4]",
    from = "[#6:1][C:2]=O.[C:3]([C:4])S(=O)(=O)c1nnnn1-c1ccccc1",
    conditions = "ylide",
    also_attacks = { "free acid", "other aldehyde", "alkyl halide", "acyl halide" },
    recipe = "KHMDS, DME, -60 °C to rt; also: benzothiazolyl sulfone",
    yield = { 65, 90 },
    source = "Kürti, Czakó, Strategic Applications of Named Reactions in Organic Synthesis; from memory",
    example { "CCCC/C=C/CCCOC1CCCCO1", from = { "CCCCC=O", "O=S(=O)(CCCCOC1CCCCO1)c1nnnn1-c1ccccc1" } },
    example { "CCC/C=C/CCC", from = { "CCCC=O", "CCCCS(=O)(=O)c1nnnn1-c1ccccc1" } },
    refuse { "CCCC/C=C\\CCC" }, -- the Z alkene: Wittig
}

disconnection "petasis-olefination" {
    about = "Methylenation of an ester (Tebbe, Petasis); enol ether, the alkene as in the carbonyl group",
    rxno = "RXNO:0000480",
    target = "[CX4:1]-[OX2:2]-[CX3;H0:3](-[#6:4])=[CX3;H2:5]",
    from = "[C:1][O:2][C:3](=O)[#6:4].[C:5][Ti](C)(C1C=CC=C1)C1C=CC=C1",
    conditions = "ylide",
    also_attacks = { "aldehyde", "ketone", "free alcohol", "free acid" },
    recipe = "Cp2TiMe2, toluene, 60-70 °C; also: Tebbe reagent, THF, -40 °C to rt",
    yield = { 60, 85 },
    source = "Tebbe, Parshall, Reddy, J. Am. Chem. Soc. 1978, 100, 3611; from memory",
    example { "C=C(OC)c1ccc(Cl)cc1", from = { "COC(=O)c1ccc(Cl)cc1", "C[Ti](C)(C1C=CC=C1)C1C=CC=C1" } },
    example { "C=C(OCC)c1ccccc1", from = { "CCOC(=O)c1ccccc1", "C[Ti](C)(C1C=CC=C1)C1C=CC=C1" } },
    refuse { "C=C(C)c1ccccc1" }, -- not an enol ether
}

disconnection "mcmurry" {
    about = "McMurry coupling; E/Z mixture where it matters",
    target = MCMURRY.target,
    from = MCMURRY.from,
    when = function(m) return joins_itself(m, MCMURRY) end,
    conditions = "zn-acid",
    also_attacks = { "aldehyde", "nitro", "epoxide", "sulfoxide", "vicinal diol", "alkyl halide" },
    recipe = "TiCl4, Zn, THF, reflux; TiCl3, LiAlH4",
    yield = { 60, 90 },
    cautions = { "titanium tetrachloride" },
    source = "Kürti, Czakó, Strategic Applications of Named Reactions in Organic Synthesis; from memory",
    example { "c1ccc(cc1)C(c1ccccc1)=C(c1ccccc1)c1ccccc1", from = { "O=C(c1ccccc1)c1ccccc1", "O=C(c1ccccc1)c1ccccc1" } },
    example { "C1CCCCC1=C1CCCCC1", from = { "O=C1CCCCC1", "O=C1CCCCC1" } },
    refuse { "CCC(C)=C(c1ccccc1)c1ccccc1" }, -- both halves are the same ketone, or one diaryl ketone and an excess of the other
}

disconnection "pinacol-coupling" {
    about = "Pinacol coupling; dl favoured with Ti(III); meso/dl mixture otherwise",
    target = PINACOL.target,
    from = PINACOL.from,
    when = function(m) return joins_itself(m, PINACOL) end,
    conditions = "zn-acid",
    also_attacks = { "nitro", "alkyl halide", "other aldehyde", "enone" },
    recipe = "Mg(Hg) or SmI2 or TiCl3/Zn, THF, rt",
    yield = { 50, 85 },
    source = "Carey, Sundberg, Advanced Organic Chemistry Part B; from memory",
    example { "OC(c1ccc(Cl)cc1)C(O)c1ccc(Cl)cc1", from = { "O=Cc1ccc(Cl)cc1", "O=Cc1ccc(Cl)cc1" } },
    example { "CC(O)(c1ccccc1)C(C)(O)c1ccccc1", from = { "CC(=O)c1ccccc1", "CC(=O)c1ccccc1" } },
    refuse { "OC(c1ccccc1)C(O)c1ccc(C)cc1" }, -- both halves are the same carbonyl compound
}

interconversion "nef" {
    about = "Nef reaction; carbonyl carbon is the one that bore the nitro group (umpolung)",
    rxno = "RXNO:0000157",
    target = "[CX4;H2,H3;!$(C-[N,O]):1]-[CX3;!R:2](=O)-[CX4;H2:3]-[CX4:4]-[CX3:5]=[OX1:6]",
    from = "[C:1][C:2]([N+](=O)[O-])-[C:3]-[C:4]-[C:5]=[O:6]",
    conditions = "acid-aq-strong",
    also_attacks = { "acid-labile acetal", "tert-butyl ester", "alkyl halide" },
    recipe = "NaOMe, MeOH, then aq. H2SO4; also: TiCl3, NH4OAc; oxone, K2CO3",
    yield = { 60, 85 },
    source = "Carey, Sundberg, Advanced Organic Chemistry Part B; from memory",
    example { "COC(=O)CCC(C)=O", from = { "COC(=O)CCC(C)[N+](=O)[O-]" } },
    example { "CCC(=O)CCC(C)=O", from = { "CCC([N+](=O)[O-])CCC(C)=O" } },
    refuse { "CCCCC(C)=O" }, -- no acceptor group γ to the ketone: no Michael addition of the nitroalkane leads here
}

disconnection "gramine-carbon-nucleophile" {
    about = "Alkylation of a stabilised carbanion by gramine; leads to tryptophans",
    target = "[c;$(c1c[nX3]c2ccccc12):1][C;X4;H2:2]-!@[C;X4;H0:3]([N:4])([C:5](=[O:6])[O:7])[C:8](=[O:9])[O:10]",
    from = "[c:1][C:2]N(C)C.[C;H1:3]([N:4])([C:5](=[O:6])[O:7])[C:8](=[O:9])[O:10]",
    conditions = "amine-heat",
    also_attacks = { "alkyl halide", "aldehyde", "enone" },
    recipe = "NaOH (cat.), toluene or xylene, reflux; also: nitroalkane, gramine methiodide",
    yield = { 70, 92 },
    cautions = { "sodium hydroxide" },
    source = "Joule and Mills, Heterocyclic Chemistry; from memory",
    example { "CCOC(=O)C(Cc1c[nH]c2ccc(F)cc12)(NC(C)=O)C(=O)OCC", from = { "CN(C)Cc1c[nH]c2ccc(F)cc12", "CCOC(=O)C(NC(C)=O)C(=O)OCC" } },
    example { "CCOC(=O)C(Cc1c[nH]c2ccccc12)(NC(C)=O)C(=O)OCC", from = { "CN(C)Cc1c[nH]c2ccccc12", "CCOC(=O)C(NC(C)=O)C(=O)OCC" } },
    refuse { "CCOC(=O)C(Cc1ccccc1)(NC(C)=O)C(=O)OCC" }, -- benzyl: from the benzyl halide
}

disconnection "epoxide-malonate-lactone" {
    about = "α-Alkoxycarbonyl-γ-lactone from an epoxide and a malonate; less hindered carbon; diastereomers " ..
        "at the acidic centre",
    target = "[O;r5:1]1[C;X3:2](=[O:3])[C;X4;H1:4]([C;X3:5](=[O:6])[O:7][C:8])[C;X4;H2:9][C;X4:10]1",
    from = "[C:2](=[O:3])(OCC)[C;H2:4][C:5](=[O:6])[O:7][C:8].[C:9]1[C:10][O:1]1",
    conditions = "alkoxide",
    also_attacks = { "alkyl halide", "aldehyde", "ketone", "acyl halide", "other epoxide" },
    recipe = "NaOEt, EtOH, rt to 50 °C",
    yield = { 65, 88 },
    source = "Carey and Sundberg, Advanced Organic Chemistry, Part B; from memory",
    example { "CCOC(=O)C1CC(COCc2ccccc2)OC1=O", from = { "CCOC(=O)CC(=O)OCC", "C(OCc1ccccc1)C1CO1" } },
    example { "CCOC(=O)C1CC(C)OC1=O", from = { "CCOC(=O)CC(=O)OCC", "CC1CO1" } },
    refuse { "CCOC(=O)C1CCOC1=S" }, -- no lactone carbonyl
}

disconnection "orthoformate-ethoxymethylenation" {
    about = "Ethoxymethylenation with triethyl orthoformate; E/Z mixture",
    target = "[C;H3:8][C;H2:9][O;X2:1][C;X3;H1:2]=[C;X3:3]([C;$(C(=O)[O,C]),$(C#N):4])[C;$(C(=O)[O,C]),$(C#N):5]",
    from = "[C:8][C:9][O:1][C;H1:2](OCC)OCC.[C;H2:3]([C:4])[C:5]",
    conditions = "acylation",
    also_attacks = { "free alcohol", "primary amine", "secondary amine", "phenol" },
    recipe = "HC(OEt)3, Ac2O, 130-140 °C, ethanol and ethyl acetate distilled off",
    yield = { 75, 95 },
    cautions = { "acetic anhydride" },
    source = "Vogel's Textbook of Practical Organic Chemistry; from memory",
    example { "CCOC=C(C(=O)OCC)C(=O)c1cc(F)c(F)cc1Cl", from = { "CCOC(OCC)OCC", "CCOC(=O)CC(=O)c1cc(F)c(F)cc1Cl" } },
    example { "CCOC=C(C(=O)OCC)C(=O)OCC", from = { "CCOC(OCC)OCC", "CCOC(=O)CC(=O)OCC" } },
    refuse { "CCOC=CC(C)=O" }, -- only one acceptor group
}

disconnection "dmf-dma-enaminone" {
    about = "Enaminone from a ketone and DMF dimethyl acetal; E",
    target = "[C;H3:7][N;X3:1]([C;H3:8])-[C;X3;H1:2]=[C;X3;H1:3][C;X3:4](=[O:5])[#6:6]",
    from = "[C:7][N:1]([C:8])[C:2](OC)OC.[C;H3:3][C:4](=[O:5])[#6:6]",
    conditions = "amine-heat",
    also_attacks = { "free acid", "phenol", "primary amine", "primary amide", "NH azole" },
    recipe = "neat or in DMF or toluene, 90-120 °C; also: diethyl acetal, Bredereck reagent",
    yield = { 75, 95 },
    cautions = { "N,N-dimethylformamide" },
    source = "Joule and Mills, Heterocyclic Chemistry; from memory",
    example { "CN(C)C=CC(=O)c1cccnc1", from = { "CN(C)C(OC)OC", "CC(=O)c1cccnc1" } },
    example { "CN(C)C=CC(=O)c1ccccc1", from = { "CN(C)C(OC)OC", "CC(=O)c1ccccc1" } },
    refuse { "CN(C)C(C)=CC(C)=O" }, -- substituted: from the 1,3-diketone
}

disconnection "dmf-dma-enaminone-ring" {
    about = "Enaminone from a methylene ketone or β-keto ester and DMF dimethyl acetal; E by preference",
    target = "[C;H3:7][N;X3:1]([C;H3:8])-[C;X3;H1:2]=[C;X3;H0:3]([#6:9])[C;X3:4](=[O:5])[#6:6]",
    from = "[C:7][N:1]([C:8])[C:2](OC)OC.[C;H2:3]([#6:9])[C:4](=[O:5])[#6:6]",
    conditions = "amine-heat",
    also_attacks = { "free acid", "phenol", "primary amine", "primary amide", "NH azole" },
    recipe = "neat or in DMF or toluene, 90-110 °C",
    yield = { 70, 92 },
    cautions = { "N,N-dimethylformamide" },
    source = "Joule and Mills, Heterocyclic Chemistry; from memory",
    example { "CN(C)C=C1CN(C(=O)OC(C)(C)C)CCC1=O", from = { "CN(C)C(OC)OC", "CC(C)(C)OC(=O)N1CCC(=O)CC1" } },
    example { "CN(C)C=C1CCCCC1=O", from = { "CN(C)C(OC)OC", "O=C1CCCCC1" } },
    refuse { "CN(C)C=CC(C)=O" }, -- an unsubstituted methyl ketone
}

disconnection "ketene-dithioacetal" {
    about = "Ketene dithioacetal from an active methylene compound",
    target = "[C;H3:6][S:1][C;X3:2]([S:3][C;H3:7])=[C;X3:4]([C;$(C(=O)[O,C,c]),$(C#N):5])[C;$(C(=O)[O,C,c]),$(C#N):8]",
    from = "[C;H2:4]([C:5])[C:8].[S:1]=[C:2]=[S:3].I[C:6].I[C:7]",
    conditions = "alkylation",
    also_attacks = { "primary amine", "thiol", "phenol", "free acid", "alkyl halide" },
    recipe = "K2CO3 or NaOEt, CS2, then MeI (2 equiv.), DMF, 0 °C to rt; also: Me2SO4",
    yield = { 75, 92 },
    cautions = { "iodomethane", "N,N-dimethylformamide", "carbon disulfide" },
    source = "Joule and Mills, Heterocyclic Chemistry; from memory",
    example { "CCOC(=O)C(C#N)=C(SC)SC", from = { "CCOC(=O)CC#N", "S=C=S", "CI", "CI" } },
    example { "CSC(SC)=C(C#N)C#N", from = { "N#CCC#N", "S=C=S", "CI", "CI" } },
    refuse { "CSC(SC)=CC(C)=O" }, -- only one acceptor group
}

disconnection "grignard-lactone-twice" {
    about = "Diol from a γ-lactone and two equivalents of a Grignard reagent; two equal groups enter",
    rxno = "RXNO:0000014",
    target = "[O;H1:1][C;X4;H0:2]([c,$([CX4;H3]):7])([c,$([CX4;H3]):8])[C;X4:3][C;X4:4][C;X4:5][O;H1:6]",
    from = "[#6:7][Mg]Br.[#6:8][Mg]Br.[O;H0:1]=[C:2]1[C:3][C:4][C:5][O;H0:6]1",
    when = function(m) return m.atom[7].symmetry == m.atom[8].symmetry end,
    conditions = "grignard",
    also_attacks = { "free alcohol", "free acid", "primary amine", "secondary amine", "aldehyde", "ketone",
        "ester", "nitrile", "acyl halide", "epoxide", "nitro", "terminal alkyne" },
    recipe = "RMgBr (2.5 equiv.), THF, 0 °C to reflux, aq. NH4Cl; also: RLi",
    yield = { 65, 88 },
    cautions = { "tetrahydrofuran" },
    source = "March's Advanced Organic Chemistry; from memory",
    example { "OCCCC(O)(c1ccc(F)cc1)c1ccc(F)cc1", from = { "Fc1ccc([Mg]Br)cc1", "Fc1ccc([Mg]Br)cc1", "O=C1CCCO1" } },
    example { "CC(C)(O)CCCO", from = { "C[Mg]Br", "C[Mg]Br", "O=C1CCCO1" } },
    refuse { "CC(O)(CCCO)c1ccccc1" }, -- the two groups 7 and 8 are the same
}

disconnection "arylacetonitrile-ketone-addition" {
    about = "Addition of an arylacetonitrile anion to a ketone; adds without loss of water below 0 °C",
    target = "[#6:1][C;X4;H0:2]([O;H1:3])([#6:4])-!@[C;X4;H1:5]([c:6])[C;X2:7]#[N:8]",
    cut = { 2, 5 },
    acceptor = { 2, "hydroxyalkyl" },
    donor = { 5, "stabilised-carbanion" },
    conditions = "organolithium",
    also_attacks = { "free alcohol", "free acid", "primary amine", "secondary amine", "aldehyde", "ketone",
        "ester", "nitrile", "acyl halide", "epoxide", "nitro", "terminal alkyne" },
    recipe = "nBuLi or LDA, THF, -78 °C, then ketone; also: NaOMe, phase transfer NaOH",
    yield = { 65, 90 },
    cautions = { "lithium diisopropylamide", "butyllithium" },
    source = "Kleemann and Engel, Pharmaceutical Substances; from memory",
    example { "COc1ccc(cc1)C(C#N)C1(O)CCCCC1", from = { "O=C1CCCCC1", "COc1ccc(CC#N)cc1" } },
    example { "N#CC(c1ccccc1)C1(O)CCCCC1", from = { "O=C1CCCCC1", "N#CCc1ccccc1" } },
    refuse { "N#CC(c1ccccc1)C1CCCCC1" }, -- no hydroxyl group
}

disconnection "acetonitrile-carbonyl-addition" {
    about = "β-Hydroxy nitrile from acetonitrile and a carbonyl compound; racemic",
    target = "[#6;!$([#6]=[O,N]):1][C;X4:2]([O;H1:3])-!@[C;X4;H2:5][C;X2:7]#[N:8]",
    cut = { 2, 5 },
    acceptor = { 2, "hydroxyalkyl" },
    donor = { 5, "stabilised-carbanion" },
    conditions = "organolithium",
    also_attacks = { "free alcohol", "free acid", "primary amine", "secondary amine", "aldehyde", "ketone",
        "ester", "nitrile", "acyl halide", "epoxide", "nitro", "terminal alkyne" },
    recipe = "nBuLi, THF, -78 °C, then ketone; also: LDA, KOH/MeCN reflux",
    yield = { 65, 88 },
    cautions = { "acetonitrile", "butyllithium" },
    source = "Carey and Sundberg, Advanced Organic Chemistry, Part B; from memory",
    example { "N#CCC(O)(c1ccccn1)c1ccccc1", from = { "O=C(c1ccccn1)c1ccccc1", "CC#N" } },
    example { "N#CCC(O)c1ccccc1", from = { "O=Cc1ccccc1", "CC#N" } },
    refuse { "N#CCCO" }, -- primary alcohol: from the epoxide and cyanide
}

disconnection "arylacetonitrile-cyclopropane" {
    about = "1-Arylcyclopropanecarbonitrile by double alkylation",
    target = "[c:1][C;X4;H0:2]1([C;X2:3]#[N:4])[C;X4;H2:5][C;X4;H2:6]1",
    from = "[c:1][C;H2:2][C:3]#[N:4].Br[C:5][C:6]Cl",
    conditions = "base-aq-strong",
    also_attacks = { "alkyl halide", "acyl halide", "aldehyde", "ketone", "ester" },
    recipe = "NaOH (50%), BnEt3NCl, 40-60 °C; also: NaH/DMSO, 1,2-dibromoethane",
    yield = { 75, 92 },
    cautions = { "1-bromo-2-chloroethane", "sodium hydroxide" },
    source = "Kleemann and Engel, Pharmaceutical Substances; from memory",
    example { "N#CC1(CC1)c1ccc(Cl)c(Cl)c1", from = { "N#CCc1ccc(Cl)c(Cl)c1", "BrCCCl" } },
    example { "N#CC1(CC1)c1ccccc1", from = { "N#CCc1ccccc1", "BrCCCl" } },
    refuse { "N#CC1CC1" }, -- no aryl group to acidify the nitrile
}

disconnection "arylacetonitrile-cyclobutane" {
    about = "1-Arylcyclobutanecarbonitrile by double alkylation",
    target = "[c:1][C;X4;H0:2]1([C;X2:3]#[N:4])[C;X4;H2:5][C;X4;H2:6][C;X4;H2:7]1",
    from = "[c:1][C;H2:2][C:3]#[N:4].Br[C:5][C:6][C:7]Br",
    conditions = "base-aq-strong",
    also_attacks = { "alkyl halide", "acyl halide", "aldehyde", "ketone", "ester" },
    recipe = "KOH or NaH, DMSO, 20-35 °C",
    yield = { 65, 85 },
    cautions = { "1,3-dibromopropane", "sodium hydride", "potassium hydroxide", "dimethyl sulfoxide" },
    source = "Kleemann and Engel, Pharmaceutical Substances; from memory",
    example { "N#CC1(CCC1)c1ccc(Cl)cc1", from = { "N#CCc1ccc(Cl)cc1", "BrCCCBr" } },
    example { "N#CC1(CCC1)c1ccccc1", from = { "N#CCc1ccccc1", "BrCCCBr" } },
    refuse { "N#CC1CCC1" }, -- no aryl group to acidify the nitrile
}

disconnection "arylacetonitrile-cyclopentane" {
    about = "1-Arylcyclopentanecarbonitrile by double alkylation",
    target = "[c:1][C;X4;H0:2]1([C;X2:3]#[N:4])[C;X4;H2:5][C;X4;H2:6][C;X4;H2:7][C;X4;H2:8]1",
    from = "[c:1][C;H2:2][C:3]#[N:4].Br[C:5][C:6][C:7][C:8]Br",
    conditions = "base-hindered",
    also_attacks = { "alkyl halide", "acyl halide", "aldehyde", "ketone", "ester" },
    recipe = "NaH, DMSO or DMF, 0 °C to rt; also: NaOH phase transfer, 1,5-dibromopentane for the six-ring",
    yield = { 70, 90 },
    cautions = { "sodium hydride", "N,N-dimethylformamide", "dimethyl sulfoxide" },
    source = "Vogel's Textbook of Practical Organic Chemistry; from memory",
    example { "COc1ccc(cc1OC1CCCC1)C1(CCCC1)C#N", from = { "COc1ccc(CC#N)cc1OC1CCCC1", "BrCCCCBr" } },
    example { "N#CC1(CCCC1)c1ccccc1", from = { "N#CCc1ccccc1", "BrCCCCBr" } },
    refuse { "N#CC1CCCC1" }, -- no aryl group to acidify the nitrile
}

disconnection "arylacetonitrile-piperidine" {
    about = "4-Arylpiperidine-4-carbonitrile by double alkylation",
    rxno = "RXNO:0000616",
    target = "[c:1][C;X4;H0:2]1([C;X2:3]#[N:4])[C;X4;H2:5][C;X4;H2:6][N;X3:9][C;X4;H2:7][C;X4;H2:8]1",
    from = "[c:1][C;H2:2][C:3]#[N:4].Cl[C:5][C:6][N:9][C:7][C:8]Cl",
    conditions = "base-hindered",
    also_attacks = { "alkyl halide", "acyl halide", "aldehyde", "ketone", "ester" },
    recipe = "NaH, DMF, 0-60 °C; also: NaNH2/toluene, NaOH phase transfer; N-methyl, N-benzyl",
    yield = { 60, 85 },
    cautions = { "bis(2-chloroethyl)amines", "sodium hydride", "N,N-dimethylformamide" },
    source = "Kleemann and Engel, Pharmaceutical Substances; from memory",
    example { "CC(C)(C)OC(=O)N1CCC(CC1)(C#N)c1cccc(F)c1", from = { "N#CCc1cccc(F)c1", "CC(C)(C)OC(=O)N(CCCl)CCCl" } },
    example { "CN1CCC(CC1)(C#N)c1ccccc1", from = { "N#CCc1ccccc1", "CN(CCCl)CCCl" } },
    refuse { "N#CC1CCNCC1" }, -- no aryl group to acidify the nitrile
}

disconnection "arylacetonitrile-dimethylation" {
    about = "Geminal dimethylation of an arylacetonitrile; both hydrogens replaced",
    target = "[c:1][C;X4;H0:2]([C;H3:5])([C;H3:6])[C;X2:3]#[N:4]",
    from = "[c:1][C;H2:2][C:3]#[N:4].I[C:5].I[C:6]",
    conditions = "base-hindered",
    also_attacks = { "alkyl halide", "acyl halide", "primary amine", "phenol", "thiol", "free acid", "epoxide",
        "free alcohol", "aldehyde", "ketone" },
    recipe = "NaH, MeI (2.5 equiv.), DMF, 0 °C to rt; also: KOtBu/THF, NaOH phase transfer",
    yield = { 80, 95 },
    cautions = { "sodium hydride", "iodomethane", "N,N-dimethylformamide" },
    source = "Kleemann and Engel, Pharmaceutical Substances; from memory",
    example { "CC(C)(C#N)c1cc(Br)cc(c1)C(C)(C)C#N", from = { "CC(C)(C#N)c1cc(Br)cc(CC#N)c1", "CI", "CI" } },
    example { "CC(C)(C#N)c1ccccc1", from = { "N#CCc1ccccc1", "CI", "CI" } },
    refuse { "CC(C#N)c1ccccc1" }, -- only one methyl group
}

disconnection "malonate-cyclopropane" {
    about = "Cyclopropane-1,1-dicarboxylate from malonate and a 1,2-dihalide",
    target = "[C;X4;H0:1]1([C;X3:2](=[O:3])[O:4][C:5])([C;X3:6](=[O:7])[O:8][C:9])[C;X4;H2:10][C;X4;H2:11]1",
    from = "[C;H2:1]([C:2](=[O:3])[O:4][C:5])[C:6](=[O:7])[O:8][C:9].Br[C:10][C:11]Br",
    conditions = "alkylation",
    also_attacks = { "alkyl halide", "acyl halide", "primary amine", "phenol", "thiol", "free acid", "epoxide",
        "aldehyde", "ketone" },
    recipe = "K2CO3, DMF or DMSO, 60-120 °C; also: NaOH phase transfer, 1-bromo-2-chloroethane",
    yield = { 65, 88 },
    cautions = { "1,2-dibromoethane", "N,N-dimethylformamide", "dimethyl sulfoxide" },
    source = "Vogel's Textbook of Practical Organic Chemistry; from memory",
    example { "CCOC(=O)C1(CC1)C(=O)OCC", from = { "CCOC(=O)CC(=O)OCC", "BrCCBr" } },
    example { "COC(=O)C1(CC1)C(=O)OC", from = { "COC(=O)CC(=O)OC", "BrCCBr" } },
    refuse { "CCOC(=O)C1CC1" }, -- only one ester group
}

disconnection "malonate-cyclobutane" {
    about = "Cyclobutane-1,1-dicarboxylate from malonate and a 1,3-dihalide (Perkin)",
    target = "[C;X4;H0:1]1([C;X3:2](=[O:3])[O:4][C:5])([C;X3:6](=[O:7])[O:8][C:9])[C;X4;H2:10][C;X4:11][C;X4;H2:12]1",
    from = "[C;H2:1]([C:2](=[O:3])[O:4][C:5])[C:6](=[O:7])[O:8][C:9].Br[C:10][C:11][C:12]Br",
    conditions = "alkoxide",
    also_attacks = { "alkyl halide", "acyl halide", "primary amine", "phenol", "thiol", "free acid", "epoxide",
        "aldehyde", "ketone" },
    recipe = "NaOEt, EtOH, reflux; also: NaH/dioxane",
    yield = { 45, 70 },
    source = "Vogel's Textbook of Practical Organic Chemistry; from memory",
    example { "CCOC(=O)C1(CC(C1)OCc1ccccc1)C(=O)OCC", from = { "CCOC(=O)CC(=O)OCC", "BrCC(CBr)OCc1ccccc1" } },
    example { "CCOC(=O)C1(CCC1)C(=O)OCC", from = { "CCOC(=O)CC(=O)OCC", "BrCCCBr" } },
    refuse { "CCOC(=O)C1CCC1" }, -- only one ester group
}

disconnection "oxindole-arylidene" {
    about = "Knoevenagel condensation of an oxindole; Z with an N-H donor on the aldehyde, else E",
    rxno = "RXNO:0000044",
    target = "[#6:1][C;X3;H1:2]=[C;X3:3]1[C;X3:4](=[O:5])[N:6]c2ccccc12",
    cut = { 2, 3 },
    acceptor = { 2, "alkylidene" },
    donor = { 3, "stabilised-carbanion" },
    conditions = "amine-rt",
    also_attacks = { "other aldehyde", "primary amine", "acyl halide", "activated ester" },
    recipe = "piperidine, EtOH, reflux",
    yield = { 75, 93 },
    cautions = { "piperidine" },
    source = "Kleemann and Engel, Pharmaceutical Substances; from memory",
    example { "CCOC(=O)c1c(C)[nH]c(C=C2C(=O)Nc3ccccc32)c1C", from = { "CCOC(=O)c1c(C)[nH]c(C=O)c1C", "O=C1Cc2ccccc2N1" } },
    example { "O=C1Nc2ccccc2C1=Cc1ccccc1", from = { "O=Cc1ccccc1", "O=C1Cc2ccccc2N1" } },
    refuse { "O=C1NCCC1=Cc1ccccc1" }, -- no benzo ring to acidify the lactam
}

disconnection "thiazolidinedione-arylidene" {
    about = "Knoevenagel condensation of thiazolidine-2,4-dione; Z",
    rxno = "RXNO:0000044",
    target = "[#6:1][C;X3;H1:2]=[C;X3:3]1[C;X3:4](=[O:5])[N:6][C;X3:7](=[O:8])[S:9]1",
    cut = { 2, 3 },
    acceptor = { 2, "alkylidene" },
    donor = { 3, "stabilised-carbanion" },
    conditions = "amine-rt",
    also_attacks = { "other aldehyde", "primary amine", "acyl halide" },
    recipe = "piperidine, EtOH or toluene/AcOH, reflux; also: rhodanine, NaOAc/AcOH",
    yield = { 75, 93 },
    cautions = { "piperidine" },
    source = "Kleemann and Engel, Pharmaceutical Substances; from memory",
    example { "O=C1NC(=O)C(=Cc2ccc(OCCc3ccccn3)cc2)S1", from = { "O=Cc1ccc(OCCc2ccccn2)cc1", "O=C1CSC(=O)N1" } },
    example { "O=C1NC(=O)C(=Cc2ccccc2)S1", from = { "O=Cc1ccccc1", "O=C1CSC(=O)N1" } },
    refuse { "O=C1NC(=O)C(Cc2ccccc2)S1" }, -- no double bond: reduce afterwards
}

disconnection "arylacetonitrile-condensation" {
    about = "α-Arylcinnamonitrile from an aldehyde and an arylacetonitrile; aryl groups cis across the " ..
        "double bond (Z)",
    rxno = "RXNO:0000044",
    target = "[#6:1][C;X3;H1:2]=[C;X3:3]([c:4])[C;X2:5]#[N:6]",
    cut = { 2, 3 },
    acceptor = { 2, "alkylidene" },
    donor = { 3, "stabilised-carbanion" },
    conditions = "alkoxide",
    also_attacks = { "other aldehyde", "ketone", "ester", "acyl halide", "alkyl halide" },
    recipe = "NaOEt or KOH, EtOH, rt; also: K2CO3/MeOH",
    yield = { 75, 95 },
    cautions = { "potassium hydroxide" },
    source = "Vogel's Textbook of Practical Organic Chemistry; from memory",
    example { "COc1ccc(cc1)C(C#N)=Cc1ccc(Br)cc1", from = { "O=Cc1ccc(Br)cc1", "COc1ccc(CC#N)cc1" } },
    example { "N#CC(=Cc1ccccc1)c1ccccc1", from = { "O=Cc1ccccc1", "N#CCc1ccccc1" } },
    refuse { "N#CC=Cc1ccccc1" }, -- no aryl group beside the nitrile
}

disconnection "thia-michael" {
    about = "Conjugate addition of a thiol; β carbon",
    rxno = "RXNO:0000008",
    target = "[#6;!$([#6]=O):1][S;X2:2]-!@[C;X4;H1,H2:3][C;X4;H1,H2:4][#6;$([CX3](=O)[#6]),$([CX3](=O)[OX2][#6]),$([CX3](=O)[NX3]),$([CX2]#N):5]",
    from = "[#6:1][S;H1:2].[C:3]=[C:4][#6:5]",
    conditions = "amine-rt",
    also_attacks = { "other enone", "alkyl halide", "acyl halide", "epoxide", "disulfide" },
    recipe = "Et3N (cat.), THF or MeOH, 0 °C to rt; also: K2CO3, DBU; acrylonitrile, enone",
    yield = { 85, 97 },
    cautions = { "triethylamine" },
    source = "Carey and Sundberg, Advanced Organic Chemistry, Part B; from memory",
    example { "COC(=O)CCSc1ccc(Cl)cc1", from = { "Sc1ccc(Cl)cc1", "C=CC(=O)OC" } },
    example { "CC(=O)CCSc1ccccc1", from = { "Sc1ccccc1", "C=CC(C)=O" } },
    refuse { "COC(=O)CSc1ccccc1" }, -- sulfur α to the ester: alkylation by a haloacetate
}

disconnection "robinson-tropinone" {
    about = "Robinson tropinone synthesis (double Mannich reaction); loses two CO2",
    target = "[C;X4:1][N;X3:2]1[C;X4;H1:3]2[C;X4;H2:4][C;X4;H2:5][C;X4;H1:6]1[C;X4;H2:7][C;X3:8](=[O:9])[C;X4;H2:10]2",
    from = "[C:1][N;H2:2].[C;H1:3](=O)[C:4][C:5][C;H1:6]=O.[C;H2:7](C(=O)O)[C:8](=[O:9])[C;H2:10]C(=O)O",
    conditions = "acid-aq-mild",
    also_attacks = { "other aldehyde", "ketone", "primary amine" },
    recipe = "buffer pH 4-5, H2O, rt to 50 °C; also: 2,5-dimethoxytetrahydrofuran with HCl, methylamine hydrochloride",
    yield = { 60, 85 },
    source = "Kleemann and Engel, Pharmaceutical Substances; from memory",
    example { "O=C1CC2CCC(C1)N2Cc1ccc(F)cc1", from = { "NCc1ccc(F)cc1", "O=CCCC=O", "OC(=O)CC(=O)CC(=O)O" } },
    example { "CN1C2CCC1CC(=O)C2", from = { "CN", "O=CCCC=O", "OC(=O)CC(=O)CC(=O)O" } },
    refuse { "CN1C2CCCC1CC(=O)C2" }, -- granatane: needs glutaraldehyde
}

disconnection "mannich-indole" {
    about = "Gramine by Mannich reaction of an indole; C3",
    rxno = "RXNO:0000032",
    target = "[c;$(c1c[nX3]c2ccccc12):1][C;X4;H2:2]-!@[N;X3;H0;!$(N-[C,S]=[O,S,N]):3]",
    from = "[cH:1].[C;H2:2]=O.[N;H1:3]",
    conditions = "acid-aq-mild",
    also_attacks = { "aldehyde", "phenol", "enolisable ketone", "primary amine", "thiol" },
    recipe = "aq. CH2O, aq. HNMe2, AcOH, 0-25 °C",
    yield = { 80, 97 },
    cautions = { "formaldehyde" },
    source = "Joule and Mills, Heterocyclic Chemistry; from memory",
    example { "CN(C)Cc1c[nH]c2ccc(OCc3ccccc3)cc12", from = { "c1ccc(COc2ccc3[nH]ccc3c2)cc1", "C=O", "CNC" } },
    example { "CN(C)Cc1c[nH]c2ccccc12", from = { "c1ccc2[nH]ccc2c1", "C=O", "CNC" } },
    refuse { "CN(C)Cc1ccccc1" }, -- benzene is not nucleophilic enough
}

disconnection "mannich-phenol" {
    about = "Mannich reaction of a phenol; ortho to OH; several sites if unblocked",
    rxno = "RXNO:0000032",
    target = "[O;H1:6][c:4]:[c:1][C;X4;H2:2]-!@[N;X3;H0;!$(N-[C,S]=[O,S,N]):3]",
    from = "[O:6][c:4]:[cH:1].[C;H2:2]=O.[N;H1:3]",
    conditions = "acid-aq-mild",
    also_attacks = { "aldehyde", "indole", "enolisable ketone", "primary amine", "other phenol" },
    recipe = "aq. CH2O, amine, EtOH, reflux",
    yield = { 60, 88 },
    cautions = { "formaldehyde" },
    source = "March's Advanced Organic Chemistry; from memory",
    example { "CN(C)Cc1cc(Cl)ccc1O", from = { "Oc1ccc(Cl)cc1", "C=O", "CNC" } },
    example { "Cc1ccc(O)c(CN2CCOCC2)c1", from = { "Oc1ccc(C)cc1", "C=O", "C1COCCN1" } },
    refuse { "COc1ccccc1CN(C)C" }, -- no free phenol
}

disconnection "mannich-furan" {
    about = "Aminomethylation of a furan; free α position of a 2-substituted furan",
    rxno = "RXNO:0000032",
    target = "[c;$(c1ccc(-[#6])o1):1][C;X4;H2:2]-!@[N;X3;H0;!$(N-[C,S]=[O,S,N]):3]",
    from = "[cH:1].[C;H2:2]=O.[N;H1:3]",
    conditions = "acid-aq-mild",
    also_attacks = { "aldehyde", "indole", "phenol", "enolisable ketone", "primary amine" },
    recipe = "paraformaldehyde, Me2NH·HCl, EtOH or AcOH, reflux",
    yield = { 60, 85 },
    cautions = { "formaldehyde" },
    source = "Kleemann and Engel, Pharmaceutical Substances; from memory",
    example { "CN(C)Cc1ccc(CO)o1", from = { "OCc1ccco1", "C=O", "CNC" } },
    example { "Cc1ccc(CN(C)C)o1", from = { "Cc1ccco1", "C=O", "CNC" } },
    refuse { "CN(C)Cc1ccco1" }, -- furan itself reacts badly: the other α position must be blocked
}

disconnection "coumarin-knoevenagel" {
    about = "Coumarin-3-carboxylate from a salicylaldehyde and malonate",
    rxno = "RXNO:0000044",
    target = "[o:1]1[c;$(c1ccccc1):2]:[c;$(c1ccccc1):3]:[cH:4]:[c:5]([C;X3:8](=[O:9])[O:10][C:11]):[c:6]1=[O:7]",
    from = "[O;H1:1]-[c:2]:[c:3]-[C;H1:4]=O.[C;H2:5]([C:8](=[O:9])[O:10][C:11])[C:6](=[O:7])OCC",
    conditions = "amine-rt",
    also_attacks = { "other aldehyde", "primary amine", "acyl halide" },
    recipe = "piperidine, AcOH, EtOH, reflux",
    yield = { 75, 92 },
    cautions = { "piperidine" },
    source = "Vogel's Textbook of Practical Organic Chemistry; from memory",
    example { "CCOC(=O)c1cc2ccc(cc2oc1=O)N(CC)CC", from = { "CCN(CC)c1ccc(C=O)c(O)c1", "CCOC(=O)CC(=O)OCC" } },
    example { "CCOC(=O)c1cc2ccccc2oc1=O", from = { "O=Cc1ccccc1O", "CCOC(=O)CC(=O)OCC" } },
    refuse { "O=c1ccc2ccccc2o1" }, -- no ester at C3
}

disconnection "wittig-methoxymethylene" {
    about = "Wittig reaction with methoxymethylenetriphenylphosphorane; E/Z mixture of no consequence",
    rxno = "RXNO:0000015",
    target = "[#6:6][C;X3:2]=!@[C;X3;H1:3][O;X2:4][C;H3:5]",
    from = "[#6:6][C:2]=O.[Cl-].[C;H2:3]([O:4][C:5])[P+](c1ccccc1)(c1ccccc1)c1ccccc1",
    conditions = "ylide",
    also_attacks = { "free acid", "acyl halide", "alkyl halide", "other aldehyde", "other ketone" },
    recipe = "KOtBu or nBuLi, THF, 0 °C, then ketone or aldehyde; also: LiHMDS",
    yield = { 70, 92 },
    cautions = { "butyllithium", "potassium tert-butoxide" },
    source = "Carey and Sundberg, Advanced Organic Chemistry, Part B; from memory",
    example { "COC=C1CCC(CC1)c1ccc(F)cc1", from = { "O=C1CCC(CC1)c1ccc(F)cc1", "[Cl-].COC[P+](c1ccccc1)(c1ccccc1)c1ccccc1" } },
    example { "COC=C1CCCCC1", from = { "O=C1CCCCC1", "[Cl-].COC[P+](c1ccccc1)(c1ccccc1)c1ccccc1" } },
    refuse { "COC(C)=CC" }, -- methoxy carbon is substituted
}

disconnection "wittig-benzylidene" {
    about = "Wittig reaction with a benzylide (semi-stabilised ylide); E/Z mixture, iodine or light turns " ..
        "it to E",
    rxno = "RXNO:0000015",
    target = "[#6;!$([#6]=[O,N]);!$(C#N):1][C;X3;H1;!R:2]=[C;X3;H1;!R:3][c:4]",
    cut = { 2, 3 },
    acceptor = { 2, "alkylidene" },
    donor = { 3, "phosphonium" },
    conditions = "ylide",
    also_attacks = { "other aldehyde", "free acid", "acyl halide", "alkyl halide" },
    recipe = "KOtBu or NaOMe, THF or MeOH, 0 °C to rt; also: K2CO3/18-crown-6",
    yield = { 70, 92 },
    cautions = { "sodium methoxide", "potassium tert-butoxide" },
    source = "Clayden, Greeves, Warren, Organic Chemistry; from memory",
    example { "COc1cc(C=Cc2ccc(F)cc2)cc(OC)c1", from = { "O=Cc1cc(OC)cc(OC)c1", "[Br-].Fc1ccc(C[P+](c2ccccc2)(c2ccccc2)c2ccccc2)cc1" } },
    example { "C(=Cc1ccccc1)c1ccccc1", from = { "O=Cc1ccccc1", "[Br-].c1ccc(C[P+](c2ccccc2)(c2ccccc2)c2ccccc2)cc1" } },
    refuse { "CC(C)=Cc1ccccc1" }, -- trisubstituted
}

disconnection "hwe-ketone-ester" {
    about = "Horner-Wadsworth-Emmons reaction of a ketone; E/Z mixtures from unsymmetrical ketones",
    rxno = "RXNO:0000056",
    target = "[#6:1][C;X3;H0:2]([#6:6])=!@[C;X3;H1:3][C;X3:4](=[O:5])[O:7][C:8]",
    cut = { 2, 3 },
    acceptor = { 2, "alkylidene" },
    donor = { 3, "phosphonate" },
    conditions = "ylide",
    also_attacks = { "aldehyde", "other ketone", "acyl halide", "alkyl halide" },
    recipe = "NaH, THF, 0 °C, then ketone; also: KOtBu, LiCl/DBU",
    yield = { 75, 95 },
    cautions = { "sodium hydride" },
    source = "Clayden, Greeves, Warren, Organic Chemistry; from memory",
    example { "CCOC(=O)C=C1CCN(CC1)C(=O)OC(C)(C)C", from = { "O=C1CCN(CC1)C(=O)OC(C)(C)C", "CCOC(=O)CP(=O)(OCC)OCC" } },
    example { "CCOC(=O)C=C1CCCCC1", from = { "O=C1CCCCC1", "CCOC(=O)CP(=O)(OCC)OCC" } },
    refuse { "CCOC(=O)C=Cc1ccccc1" }, -- from an aldehyde: the ordinary row
}

disconnection "hwe-ketone-nitrile" {
    about = "Horner-Wadsworth-Emmons cyanomethylenation of a ketone; E/Z mixtures from unsymmetrical ketones",
    rxno = "RXNO:0000056",
    target = "[#6:1][C;X3;H0:2]([#6:6])=!@[C;X3;H1:3][C;X2:4]#[N:5]",
    cut = { 2, 3 },
    acceptor = { 2, "alkylidene" },
    donor = { 3, "phosphonate" },
    conditions = "ylide",
    also_attacks = { "aldehyde", "other ketone", "acyl halide", "alkyl halide" },
    recipe = "KOtBu or NaH, THF, 0 °C to rt; also: LiBr/Et3N",
    yield = { 75, 95 },
    cautions = { "sodium hydride", "potassium tert-butoxide" },
    source = "Kleemann and Engel, Pharmaceutical Substances; from memory",
    example { "CCS(=O)(=O)N1CC(=CC#N)C1", from = { "CCS(=O)(=O)N1CC(=O)C1", "N#CCP(=O)(OCC)OCC" } },
    example { "N#CC=C1CCCCC1", from = { "O=C1CCCCC1", "N#CCP(=O)(OCC)OCC" } },
    refuse { "N#CC=Cc1ccccc1" }, -- from an aldehyde: the ordinary row
}

disconnection "fc-oxindole" {
    about = "Oxindole by Friedel-Crafts cyclisation of a chloroacetanilide (Stollé); ortho to nitrogen on " ..
        "the more reactive ring",
    rxno = "RXNO:0000046",
    target = "[c:1]1:[c:2][N;X3;r5:3][C;X3;r5:4](=[O:5])[C;X4;H2;r5:6]1",
    from = "[cH:1]:[c:2][N:3][C:4](=[O:5])[C:6]Cl",
    conditions = "lewis-acid",
    also_attacks = { "aryl methyl ether", "other electron-rich arene", "ester", "alkene" },
    recipe = "AlCl3, melt at 160 °C or chlorobenzene reflux",
    yield = { 70, 92 },
    cautions = { "aluminium chloride" },
    source = "Kleemann and Engel, Pharmaceutical Substances; from memory",
    example { "O=C1Cc2ccccc2N1c1c(Cl)cccc1Cl", from = { "O=C(CCl)N(c1ccccc1)c1c(Cl)cccc1Cl" } },
    example { "CN1C(=O)Cc2ccccc21", from = { "CN(C(=O)CCl)c1ccccc1" } },
    refuse { "O=C1NCc2ccccc12" }, -- an isoindolinone
}

disconnection "fc-tetramethyltetralin" {
    about = "Tetramethyltetralin by double Friedel-Crafts alkylation; ring closes at two vicinal free positions",
    rxno = "RXNO:0000046",
    target = "[c:1]1:[c:2][C;X4:3]([C;H3:4])([C;H3:5])[C;H2:6][C;H2:7][C;X4:8]1([C;H3:9])[C;H3:10]",
    from = "[cH:1]:[cH:2].[C:3](Cl)([C:4])([C:5])[C:6][C:7][C:8](Cl)([C:9])[C:10]",
    conditions = "lewis-acid",
    also_attacks = { "other electron-rich arene", "alkene", "acetal", "tertiary alcohol" },
    recipe = "AlCl3 (5 mol%), CH2Cl2, 0 °C to rt; also: diol with AlCl3 or H2SO4",
    yield = { 75, 95 },
    cautions = { "aluminium chloride" },
    source = "Kleemann and Engel, Pharmaceutical Substances; from memory",
    example { "Cc1cc2c(cc1Br)C(C)(C)CCC2(C)C", from = { "Cc1ccccc1Br", "CC(C)(Cl)CCC(C)(C)Cl" } },
    example { "CC1(C)CCC(C)(C)c2ccccc21", from = { "c1ccccc1", "CC(C)(Cl)CCC(C)(C)Cl" } },
    refuse { "c1ccc2CCCCc2c1" }, -- no gem-dimethyl groups: primary cations rearrange
}

disconnection "hantzsch-two-component" {
    about = "Dihydropyridine from an enamino ester and an arylidene keto ester; unsymmetrical esters, racemic",
    rxno = "RXNO:0000268",
    target = "[N;X3;H1:1]1[C;X3:2]=[C;X3:3]([C;X3:7]=[O:8])[C;X4;H1:4][C;X3:5]([C;X3:9]=[O:10])=[C;X3:6]1",
    from = "[N;H2:1][C:2]=[C;H1:3][C:7]=[O:8].[C;H1:4]=[C:5]([C:9]=[O:10])[C:6]=O",
    conditions = "amine-heat",
    also_attacks = { "other aldehyde", "primary amine", "alkyl halide", "acyl halide" },
    recipe = "EtOH or iPrOH, reflux",
    yield = { 55, 80 },
    source = "Kleemann and Engel, Pharmaceutical Substances; from memory",
    example { "CCOC(=O)C1=C(C)NC(C)=C(C(=O)OC)C1c1cccc(Cl)c1Cl", from = { "CCOC(=O)C=C(C)N", "COC(=O)C(=Cc1cccc(Cl)c1Cl)C(C)=O" } },
    example { "CCOC(=O)C1=C(C)NC(C)=C(C(=O)OC)C1c1cccc([N+](=O)[O-])c1", from = { "CCOC(=O)C=C(C)N", "COC(=O)C(=Cc1cccc([N+](=O)[O-])c1)C(C)=O" } },
    refuse { "CN1C=CC(c2ccccc2)C=C1" }, -- no acceptor groups and N-methyl
}

disconnection "hetero-diels-alder-enone" {
    about = "Dihydropyran by inverse hetero-Diels-Alder reaction of an enal with an enol ether; oxygen " ..
        "substituent next to ring oxygen",
    rxno = "RXNO:0000313",
    target = "[O;X2:1]1[C;X3;H1:2]=[C;X3:3][C;X4:4][C;X4;H2:5][C;X4;H1:6]1[O;X2:7][C;X4:8]",
    from = "[O:1]=[C;H1:2][C:3]=[C:4].[C;H2:5]=[C;H1:6][O:7][C:8]",
    conditions = "heat-200",
    also_attacks = { "other diene", "primary amine", "thiol" },
    recipe = "neat, 150-190 °C, hydroquinone; also: Yb(fod)3 or Eu(fod)3, rt",
    yield = { 65, 88 },
    source = "Vogel's Textbook of Practical Organic Chemistry; from memory",
    example { "CCOC1CC(C)C=CO1", from = { "CC=CC=O", "C=COCC" } },
    example { "CCOC1CCC=CO1", from = { "C=CC=O", "C=COCC" } },
    refuse { "C1CCOC=C1" }, -- no acetal carbon
}

disconnection "nitrile-lda-alkylation" {
    about = "Alkylation of a lithiated alkanenitrile; dialkylation is suppressed with a full equivalent of base",
    target = "[N;X1:1]#[C;X2:2]-[C;X4;H0,H1;!$(C-c);!$(C-C=O);!$(C(C#N)C#N):3]-!@[C;X4;H2,H3;!$(C-[O,N,S,F,Cl,Br,I]);!$(C-C#N);!$(C-C=O):4]",
    cut = { 4, 3 },
    acceptor = { 4, "alkyl" },
    donor = { 3, "enolate" },
    conditions = "base-hindered",
    also_attacks = { "free alcohol", "free acid", "primary amine", "secondary amine", "aldehyde", "ketone",
        "ester", "nitrile", "acyl halide", "epoxide", "nitro", "terminal alkyne", "alkyl halide" },
    recipe = "LDA, THF, -78 °C, then RBr; also: LiHMDS, KHMDS, alkyl iodide",
    yield = { 70, 92 },
    cautions = { "lithium diisopropylamide" },
    source = "Carey and Sundberg, Advanced Organic Chemistry, Part B; from memory",
    example { "CC(C)(C)OC(=O)N1CCC(C#N)(Cc2ccccc2)CC1", from = { "CC(C)(C)OC(=O)N1CCC(C#N)CC1", "BrCc1ccccc1" } },
    example { "N#CC1(CCCCC1)Cc1ccccc1", from = { "N#CC1CCCCC1", "BrCc1ccccc1" } },
    refuse { "N#CCCc1ccccc1" }, -- unbranched chain: from the alkyl halide and cyanide
}

disconnection "claisen-schmidt" {
    about = "Claisen-Schmidt condensation; E alkene",
    rxno = "RXNO:0000595",
    target = "[c:1]/?[CX3;H1;!R:2]=[CX3;H1;!R:3]/?[CX3;$(C([#6])[#6]):4]=[OX1:5]",
    cut = { 2, 3 },
    acceptor = { 2, "alkylidene" },
    donor = { 3, "enolate" },
    conditions = "base-aq-mild",
    also_attacks = { "aldehyde", "ketone", "acyl halide", "activated ester" },
    recipe = "NaOH or KOH, EtOH/H2O, 0 °C to rt; also: Ba(OH)2, acid (HCl)",
    yield = { 70, 95 },
    source = "Vogel's Textbook of Practical Organic Chemistry; from memory",
    example { "COc1ccc(/C=C/C(=O)c2ccncc2)cc1", from = { "COc1ccc(C=O)cc1", "CC(=O)c1ccncc1" } },
    example { "O=C(/C=C/c1ccccc1)c1ccccc1", from = { "O=Cc1ccccc1", "CC(=O)c1ccccc1" } },
    refuse { "O=C(/C=C\\c1ccccc1)c1ccccc1" }, -- the Z enone is not what the reaction gives
}

disconnection "intramolecular-aldol-condensation" {
    about = "Intramolecular aldol condensation; five or six ring, the more substituted alkene",
    rxno = "RXNO:0000017",
    target = "[#6:5]-[CX3;r5,r6:1]=;@[CX3;r5,r6:2]-[CX3;$(C([#6])[#6]):3]=[OX1:4]",
    from = "([#6:5][C:1]=O.[C:2][C:3]=[O:4])",
    conditions = "base-aq-mild",
    also_attacks = { "aldehyde", "ketone", "acyl halide" },
    recipe = "aq. NaOH, EtOH, reflux; also: TsOH, toluene, reflux",
    yield = { 60, 90 },
    source = "Clayden, Greeves, Warren, Organic Chemistry; from memory",
    example { "CC/C=C\\CC1=C(C)CCC1=O", from = { "CC/C=C\\CCC(=O)CCC(C)=O" } },
    example { "CC1=CC(=O)CC1", from = { "CC(=O)CCC(C)=O" } },
    refuse { "CC1=CCCCCCC1=O" }, -- an eight-membered ring: only five- and six-membered ones form well
}

disconnection "knoevenagel" {
    about = "Knoevenagel condensation; the bulkier acceptor group trans to R",
    rxno = "RXNO:0000044",
    target = "[#6:1]-[CX3;H1;!R:2]=!@[CX3:3](-[#6;$([CX3](=O)([#6])[#6]),$([CX3](=O)[OX2][#6]),$([CX3](=O)[NX3]),$([CX2]#N):4])-[#6;$([CX3](=O)([#6])[#6]),$([CX3](=O)[OX2][#6]),$([CX3](=O)[NX3]),$([CX2]#N):5]",
    cut = { 2, 3 },
    acceptor = { 2, "alkylidene" },
    donor = { 3, "stabilised-carbanion" },
    conditions = "base-aq-mild",
    also_attacks = { "other aldehyde", "primary amine", "acyl halide" },
    recipe = "piperidine/AcOH, toluene, Dean-Stark; ketones: TiCl4, pyridine",
    yield = { 70, 95 },
    source = "Clayden, Greeves, Warren, Organic Chemistry; from memory",
    example { "CCOC(=O)C(C#N)=Cc1ccc(F)cc1", from = { "O=Cc1ccc(F)cc1", "CCOC(=O)CC#N" } },
    example { "N#CC(C#N)=Cc1ccccc1", from = { "O=Cc1ccccc1", "N#CCC#N" } },
    refuse { "CCOC(=O)C=Cc1ccccc1" }, -- only one electron-withdrawing group: Horner-Wadsworth-Emmons or Doebner
}

disconnection "doebner" {
    about = "Doebner reaction; E alkene",
    rxno = "RXNO:0000126",
    target = "[#6;$(c),$([CX4]):1]/?[CX3;H1;!R:2]=[CX3;H1;!R:3]/?[CX3:4](=[OX1:5])-[OX2H1:6]",
    from = "[#6:1][C:2]=O.[C:3]([C:4](=[O:5])[O:6])C(=O)O",
    conditions = "base-aq-mild",
    also_attacks = { "other aldehyde", "acyl halide" },
    recipe = "pyridine, piperidine cat., 80-110 °C, loss of CO2",
    yield = { 70, 95 },
    cautions = { "pyridine" },
    source = "Vogel's Textbook of Practical Organic Chemistry; from memory",
    example { "COc1cc(/C=C/C(=O)O)ccc1O", from = { "COc1cc(C=O)ccc1O", "O=C(O)CC(=O)O" } },
    example { "OC(=O)/C=C/c1ccccc1", from = { "O=Cc1ccccc1", "O=C(O)CC(=O)O" } },
    refuse { "O=C(O)/C=C\\c1ccccc1" }, -- the Z acid is not formed
}

disconnection "henry" {
    about = "Henry reaction; little syn/anti selectivity",
    rxno = "RXNO:0000086",
    target = "[#6;!$([#6]=[O,N,S]);!$([#6]#[N,C]):1]-[CX4;H1;!R:2]([OX2H1:3])-!@[CX4:4]-[NX3+:5](=[OX1:6])-[O-:7]",
    cut = { 2, 4 },
    acceptor = { 2, "hydroxyalkyl" },
    donor = { 4, "nitronate" },
    conditions = "base-aq-mild",
    also_attacks = { "other aldehyde", "acyl halide", "alkyl halide" },
    recipe = "Et3N or KOtBu cat. or NaOH, EtOH, 0 °C to rt",
    yield = { 60, 90 },
    cautions = { "nitromethane" },
    source = "Carey, Sundberg, Advanced Organic Chemistry Part B; from memory",
    example { "O=[N+]([O-])CC(O)C1CCN(C(=O)OCc2ccccc2)CC1", from = { "O=CC1CCN(C(=O)OCc2ccccc2)CC1", "C[N+](=O)[O-]" } },
    example { "O=[N+]([O-])CC(O)c1ccccc1", from = { "O=Cc1ccccc1", "C[N+](=O)[O-]" } },
    refuse { "CC(C)(O)C[N+](=O)[O-]" }, -- ketones give the alcohol poorly: the reaction is reversible
}

disconnection "mannich" {
    about = "Mannich reaction; at the more substituted α carbon in protic media",
    rxno = "RXNO:0000032",
    target = "[NX3;H0;!$(N-[C,S]=[O,S,N]);!$(N-[O,N]);!$(N-c):1]-[CX4;H2:2]-!@[CX4:3]-[CX3;$(C([#6])[#6]):4]=[OX1:5]",
    from = "[N:1].[C:2]=O.[C:3][C:4]=[O:5]",
    conditions = "acid-aq-mild",
    also_attacks = { "primary amine", "phenol", "indole", "other ketone", "aldehyde" },
    recipe = "amine hydrochloride, paraformaldehyde, EtOH, cat. HCl, reflux; also: Eschenmoser's salt",
    yield = { 60, 85 },
    cautions = { "formaldehyde" },
    source = "Vogel's Textbook of Practical Organic Chemistry; from memory",
    example { "CN(C)CCC(=O)c1cccs1", from = { "CNC", "C=O", "CC(=O)c1cccs1" } },
    example { "CN(C)CCC(=O)c1ccccc1", from = { "CNC", "C=O", "CC(=O)c1ccccc1" } },
    refuse { "CN(C)CCC(=O)OC" }, -- an ester does not enolise: aza-Michael
}

disconnection "michael-malonate" {
    about = "Michael addition of a stabilised carbanion; 1,4-addition",
    rxno = "RXNO:0000009",
    target = "[CX4;H0,H1;$(C([CX3](=O)[O,#6])[CX3](=O)[O,#6]),$(C([CX3](=O)[O,#6])C#N):1]-!@[CX4:2]-[CX4;H1,H2:3]-[#6;$([CX3](=O)([#6])[#6]),$([CX3](=O)[OX2][#6]),$([CX3](=O)[NX3]),$([CX2]#N):4]",
    cut = { 2, 1 },
    acceptor = { 2, "beta-acceptor" },
    donor = { 1, "stabilised-carbanion" },
    conditions = "alkoxide",
    also_attacks = { "alkyl halide", "aldehyde", "acyl halide", "other enone" },
    recipe = "NaOMe cat., MeOH, rt; also: DBU, K2CO3, Triton B",
    yield = { 70, 95 },
    source = "Clayden, Greeves, Warren, Organic Chemistry; from memory",
    example { "COC(=O)C(C1CCCC(=O)C1)C(=O)OC", from = { "COC(=O)CC(=O)OC", "O=C1C=CCCC1" } },
    example { "CCOC(=O)C(CCC(C)=O)C(=O)OCC", from = { "CCOC(=O)CC(=O)OCC", "C=CC(C)=O" } },
    refuse { "COC(=O)CCCC(=O)OC" }, -- the donor carbon bears only one activating group
}

disconnection "perkin" {
    about = "Perkin reaction; E alkene",
    rxno = "RXNO:0000003",
    target = "[c:1]/?[CX3;H1;!R:2]=[CX3;H1;!R:3]/?[CX3:4](=[OX1:5])-[OX2H1:6]",
    from = "[c:1][C:2]=O.[C:3][C:4](=[O:5])[O:6]C(C)=O",
    conditions = "heat-200",
    also_attacks = { "free alcohol", "phenol", "primary amine", "secondary amine" },
    recipe = "NaOAc, Ac2O, 140-180 °C",
    yield = { 45, 80 },
    cautions = { "acetic anhydride" },
    source = "Vogel's Textbook of Practical Organic Chemistry; from memory",
    example { "O=C(O)/C=C/c1ccc([N+](=O)[O-])cc1", from = { "O=Cc1ccc([N+](=O)[O-])cc1", "CC(=O)OC(C)=O" } },
    example { "O=C(O)/C=C/c1ccccc1", from = { "O=Cc1ccccc1", "CC(=O)OC(C)=O" } },
    refuse { "CCC/C=C/C(=O)O" }, -- aliphatic aldehydes condense with themselves
}

disconnection "darzens" {
    about = "Darzens glycidic ester condensation; mixture, trans preferred with aldehydes",
    rxno = "RXNO:0000077",
    target = "[#6:1]-[CX4;H0,H1;r3:2]1-[OX2:3]-[CX4;H0,H1;r3:4]-1-[CX3:5](=[OX1:6])-[OX2:7]-[CX4:8]",
    from = "[#6:1][C:2]=[O:3].Cl[C:4][C:5](=[O:6])[O:7][C:8]",
    conditions = "alkoxide",
    also_attacks = { "free acid", "aldehyde", "alkyl halide", "acyl halide", "thiol" },
    recipe = "NaOEt or KOtBu, tBuOH, 0-10 °C; also: bromo ester",
    yield = { 55, 85 },
    cautions = { "ethyl chloroacetate (lachrymator)" },
    source = "Carey, Sundberg, Advanced Organic Chemistry Part B; from memory",
    example { "CCOC(=O)C1OC1(C)c1ccc(CC(C)C)cc1", from = { "CC(=O)c1ccc(CC(C)C)cc1", "CCOC(=O)CCl" } },
    example { "CCOC(=O)C1OC1c1ccccc1", from = { "O=Cc1ccccc1", "CCOC(=O)CCl" } },
    refuse { "CC1OC1CO" }, -- no ester at the epoxide
}

disconnection "malonic-ester-synthesis" {
    about = "Malonic ester synthesis; SN2; two carbons added, ester hydrolysed and CO2 lost at the end",
    rxno = "RXNO:0000107",
    target = "[OX2H1:1]-[CX3:2](=[OX1:3])-[CX4;H2:4]-!@[CX4;H2,H3;!$(C-[O,N,S,F,Cl,Br,I]);!$([CX4][CX4]([CX4])([CX4])[CX4]):5]",
    from = "[O:1](CC)[C:2](=[O:3])[C:4]C(=O)OCC.Br[C:5]",
    conditions = "alkoxide",
    also_attacks = { "free acid", "alkyl halide", "aldehyde", "acyl halide", "epoxide", "ester" },
    recipe = "NaOEt, EtOH, reflux; KOH; aq. HCl, reflux; also: I, OTs",
    yield = { 55, 80 },
    cautions = { "sodium ethoxide" },
    source = "Clayden, Greeves, Warren, Organic Chemistry; from memory",
    example { "O=C(O)CCc1ccc2c(c1)OCO2", from = { "CCOC(=O)CC(=O)OCC", "BrCc1ccc2c(c1)OCO2" } },
    example { "O=C(O)CCc1ccccc1", from = { "CCOC(=O)CC(=O)OCC", "BrCc1ccccc1" } },
    refuse { "O=C(O)CC(C)(C)C" }, -- a tertiary halide eliminates
}

disconnection "active-methylene-alkylation" {
    about = "Alkylation of a malonate, acetoacetate or cyanoacetate; C-alkylation; dialkylation is the rival where H remains",
    target = "[CX4;H0,H1;$(C([CX3](=O)[O,#6])[CX3](=O)[O,#6]),$(C([CX3](=O)[O,#6])C#N);!$(C-C(=O)[OX2H1]):1]-!@[CX4;H2,H3;!$(C-[O,N,S,F,Cl,Br,I]);!$([CX4][CX4]([CX4])([CX4])[CX4]):2]",
    cut = { 2, 1 },
    acceptor = { 2, "alkyl" },
    donor = { 1, "stabilised-carbanion" },
    conditions = "alkoxide",
    also_attacks = { "alkyl halide", "aldehyde", "acyl halide", "epoxide", "free acid", "enone" },
    recipe = "NaH, DMF or NaOEt, EtOH, 0-60 °C; also: K2CO3, acetone; I, OTs, Cl",
    yield = { 65, 90 },
    cautions = { "sodium hydride" },
    source = "Clayden, Greeves, Warren, Organic Chemistry; from memory",
    example { "CCOC(=O)C(CC=C)(CCC#N)C(=O)OCC", from = { "CCOC(=O)C(CCC#N)C(=O)OCC", "C=CCBr" } },
    example { "CCOC(=O)C(Cc1ccccc1)C(C)=O", from = { "CCOC(=O)CC(C)=O", "BrCc1ccccc1" } },
    refuse { "COC(=O)C(C(=O)OC)C(C)(C)C" }, -- tertiary halides eliminate
}

disconnection "acetoacetic-ester-synthesis" {
    about = "Acetoacetic ester synthesis; SN2; methyl ketone with three carbons added",
    rxno = "RXNO:0000459",
    target = "[CX4;H3:1]-[CX3:2](=[OX1:3])-[CX4;H2:4]-!@[CX4;H2,H3;!$(C-[O,N,S,F,Cl,Br,I]);!$([CX4][CX4]([CX4])([CX4])[CX4]):5]",
    from = "[C:1][C:2](=[O:3])[C:4]C(=O)OCC.Br[C:5]",
    conditions = "alkoxide",
    also_attacks = { "alkyl halide", "aldehyde", "acyl halide", "epoxide", "ester" },
    recipe = "K2CO3, acetone, or NaOEt, EtOH; then aq. HCl or NaOH, reflux; also: I, OTs",
    yield = { 55, 80 },
    cautions = { "sodium ethoxide" },
    source = "Clayden, Greeves, Warren, Organic Chemistry; from memory",
    example { "COc1ccc2cc(CCC(C)=O)ccc2c1", from = { "CCOC(=O)CC(C)=O", "COc1ccc2cc(CBr)ccc2c1" } },
    example { "CC(=O)CCc1ccccc1", from = { "CCOC(=O)CC(C)=O", "BrCc1ccccc1" } },
    refuse { "CC(=O)CC(C)(C)C" }, -- a tertiary halide eliminates
}

disconnection "cyanohydrin" {
    about = "Cyanohydrin formation; reversible; hindered and diaryl ketones give little",
    target = "[#6;!$([#6]#N):1]-[CX4:2]([OX2H1:3])-[CX2;+0:4]#[NX1:5]",
    cut = { 2, 4 },
    acceptor = { 2, "hydroxyalkyl" },
    donor = { 4, "cyanide" },
    conditions = "cyanide",
    also_attacks = { "other aldehyde", "acyl halide", "alkyl halide", "enone" },
    recipe = "NaCN, aq. NaHSO3 or AcOH, 0 °C; also: TMSCN, ZnI2 cat.; KCN, acetone cyanohydrin",
    yield = { 65, 90 },
    cautions = { "sodium cyanide", "hydrogen cyanide" },
    source = "Vogel's Textbook of Practical Organic Chemistry; from memory",
    example { "N#CC1(O)CCN(Cc2ccccc2)CC1", from = { "O=C1CCN(Cc2ccccc2)CC1", "[Na+].[C-]#N" } },
    example { "N#CC(O)c1ccccc1", from = { "O=Cc1ccccc1", "[Na+].[C-]#N" } },
    refuse { "N#CCCO" }, -- OH and CN on different carbons
}

disconnection "wittig-z" {
    about = "Wittig reaction with a non-stabilised ylide; Z alkene (salt-free, lithium-free)",
    rxno = "RXNO:0000015",
    target = "[#6:1]/[CX3;H1;!R:2]=[CX3;H1;!R:3]\\[CX4;!$(C-[O,N,S,F,Cl,Br,I]):4]",
    cut = { 2, 3 },
    acceptor = { 2, "alkylidene" },
    donor = { 3, "phosphonium" },
    conditions = "ylide",
    also_attacks = { "free acid", "other aldehyde", "alkyl halide", "acyl halide", "ketone" },
    recipe = "NaHMDS or KHMDS, THF, -78 °C to rt; also: iodide salt",
    yield = { 60, 85 },
    cautions = { "butyllithium" },
    source = "Clayden, Greeves, Warren, Organic Chemistry; from memory",
    example { "CCCC/C=C\\CCCCO[Si](C)(C)C(C)(C)C", from = { "O=CCCCCO[Si](C)(C)C(C)(C)C", "[Br-].CCCCC[P+](c1ccccc1)(c1ccccc1)c1ccccc1" } },
    example { "CCC/C=C\\CCC", from = { "CCCC=O", "[Br-].CCCC[P+](c1ccccc1)(c1ccccc1)c1ccccc1" } },
    refuse { "CCCC/C=C/CCCCO" }, -- the E alkene: Julia-Kocienski or Schlosser's variant
}

disconnection "wittig-stabilised" {
    about = "Wittig reaction with a stabilised ylide; E alkene; aldehydes only",
    rxno = "RXNO:0000015",
    target = "[#6:1]/?[CX3;H1;!R:2]=[CX3;!R:3]/?[CX3;$(C(=O)([#6])[#6]),$(C(=O)[OX2][#6]),H1:4]=[OX1:5]",
    cut = { 2, 3 },
    acceptor = { 2, "alkylidene" },
    donor = { 3, "ylide" },
    conditions = "ylide",
    also_attacks = { "other aldehyde", "acyl halide" },
    recipe = "CH2Cl2 or toluene, rt to reflux",
    yield = { 70, 95 },
    cautions = { "dichloromethane" },
    source = "Clayden, Greeves, Warren, Organic Chemistry; from memory",
    example { "COC(=O)/C=C/C1CCN(C(=O)OC(C)(C)C)CC1", from = { "O=CC1CCN(C(=O)OC(C)(C)C)CC1", "COC(=O)C=P(c1ccccc1)(c1ccccc1)c1ccccc1" } },
    example { "CCOC(=O)/C=C/c1ccccc1", from = { "O=Cc1ccccc1", "CCOC(=O)C=P(c1ccccc1)(c1ccccc1)c1ccccc1" } },
    refuse { "COC(=O)/C=C\\c1ccccc1" }, -- the Z ester: Still-Gennari
}

disconnection "wittig-methylenation" {
    about = "Wittig methylenation; position of the double bond as in the carbonyl group",
    rxno = "RXNO:0000091",
    target = "[#6;!$([#6]=[O,N,S]);!$([#6]#[N,C]):1]-[CX3;H0:2](-[#6;!$([#6]=[O,N,S]);!$([#6]#[N,C]):3])=[CX3;H2:4]",
    cut = { 2, 4 },
    acceptor = { 2, "alkylidene" },
    donor = { 4, "phosphonium" },
    conditions = "ylide",
    also_attacks = { "free acid", "other aldehyde", "alkyl halide", "acyl halide", "ketone" },
    recipe = "MePPh3Br, BuLi or KOtBu, THF, 0 °C to rt",
    yield = { 65, 90 },
    cautions = { "butyllithium" },
    source = "Clayden, Greeves, Warren, Organic Chemistry; from memory",
    example { "C=C1CCC2(CC1)OCCO2", from = { "O=C1CCC2(CC1)OCCO2", "[Br-].C[P+](c1ccccc1)(c1ccccc1)c1ccccc1" } },
    example { "C=C1CCCCC1", from = { "O=C1CCCCC1", "[Br-].C[P+](c1ccccc1)(c1ccccc1)c1ccccc1" } },
    refuse { "C=C(OC)c1ccccc1" }, -- an enol ether from an ester: Tebbe or Petasis reagent
}

disconnection "hwe-e" {
    about = "Horner-Wadsworth-Emmons reaction; E alkene",
    rxno = "RXNO:0000056",
    target = "[#6:1]/?[CX3;H1;!R:2]=[CX3;!R:3]/?[#6;$([CX3](=O)([#6])[#6]),$([CX3](=O)[OX2][#6]),$([CX3](=O)[NX3]),$([CX2]#N):4]",
    cut = { 2, 3 },
    acceptor = { 2, "alkylidene" },
    donor = { 3, "phosphonate" },
    conditions = "ylide",
    also_attacks = { "free acid", "other aldehyde", "alkyl halide", "acyl halide" },
    recipe = "NaH, THF or DBU, LiCl, MeCN (Masamune-Roush), 0 °C to rt; also: dimethyl phosphonate",
    yield = { 70, 95 },
    cautions = { "sodium hydride" },
    source = "Wadsworth, Emmons, J. Am. Chem. Soc. 1961, 83, 1733; from memory",
    example { "CCOC(=O)/C=C/c1ccc(OC)c(OCc2ccccc2)c1", from = { "COc1ccc(C=O)cc1OCc1ccccc1", "CCOC(=O)CP(=O)(OCC)OCC" } },
    example { "CCOC(=O)/C=C/c1ccccc1", from = { "O=Cc1ccccc1", "CCOC(=O)CP(=O)(OCC)OCC" } },
    refuse { "CCOC(=O)/C=C\\C" }, -- the Z ester: Still-Gennari
}

disconnection "hwe-benzylic" {
    about = "Horner-Wadsworth-Emmons reaction of a benzylic phosphonate (E-stilbene); E",
    rxno = "RXNO:0000056",
    target = "[c:1]/?[C;X3;H1;!R:2]=[C;X3;H1;!R:3]/?[c:4]",
    cut = { 2, 3 },
    acceptor = { 2, "alkylidene" },
    donor = { 3, "phosphonate" },
    conditions = "ylide",
    also_attacks = { "other aldehyde", "ketone", "acyl halide", "alkyl halide" },
    recipe = "NaH or KOtBu, THF or DMF, 0 °C to rt; also: NaOMe/DMF",
    yield = { 75, 95 },
    cautions = { "sodium hydride", "N,N-dimethylformamide", "potassium tert-butoxide" },
    source = "Clayden, Greeves, Warren, Organic Chemistry; from memory",
    example { "COc1cc(/C=C/c2ccc(OCc3ccccc3)cc2)cc(OC)c1", from = { "O=Cc1ccc(OCc2ccccc2)cc1", "CCOP(=O)(OCC)Cc1cc(OC)cc(OC)c1" } },
    example { "c1ccc(cc1)/C=C/c1ccccc1", from = { "O=Cc1ccccc1", "CCOP(=O)(OCC)Cc1ccccc1" } },
    refuse { "c1ccccc1/C=C\\c1ccccc1" }, -- a Z double bond
}

disconnection "conjugate-cyanide" {
    about = "Conjugate addition of cyanide (Nagata); 1,4-addition",
    rxno = "RXNO:0000008",
    target = "[NX1:1]#[CX2;+0:2]-[CX4:3]-[CX4;H1,H2:4]-[CX3;$(C([#6])[#6]):5]=[OX1:6]",
    cut = { 3, 2 },
    acceptor = { 3, "beta-acceptor" },
    donor = { 2, "cyanide" },
    conditions = "cyanide",
    also_attacks = { "alkyl halide", "aldehyde", "acyl halide", "epoxide" },
    recipe = "Et2AlCN, toluene, rt; or NaCN, NH4Cl, aq. DMF, 80 °C; TMSCN",
    yield = { 60, 90 },
    cautions = { "sodium cyanide", "diethylaluminium cyanide" },
    source = "Carey, Sundberg, Advanced Organic Chemistry Part B; from memory",
    example { "N#CC1CCCC(=O)C1", from = { "[C-]#N.[Na+]", "O=C1C=CCCC1" } },
    example { "N#CC1CCC(=O)C1", from = { "[Na+].[C-]#N", "O=C1C=CCC1" } },
    refuse { "N#CC1(O)CCCCC1" }, -- a cyanohydrin: 1,2-addition
}

disconnection "aza-michael" {
    about = "Aza-Michael addition; anti-Markovnikov; primary amines may add twice",
    rxno = "RXNO:0000008",
    target = "[NX3;+0;!$(N-[C,S]=[O,S,N]);!$(N-c):1]-!@[CX4;H1,H2:2]-[CX4;H1,H2:3]-[#6;$([CX3](=O)([#6])[#6]),$([CX3](=O)[OX2][#6]),$([CX3](=O)[NX3]),$([CX2]#N):4]",
    cut = { 2, 1 },
    acceptor = { 2, "beta-acceptor" },
    donor = { 1, "amine" },
    conditions = "amine-rt",
    also_attacks = { "other enone", "alkyl halide", "acyl halide", "aldehyde", "epoxide" },
    recipe = "neat or MeOH, rt; Lewis acid or DBU for weak nucleophiles",
    yield = { 75, 95 },
    cautions = { "methyl acrylate" },
    source = "Clayden, Greeves, Warren, Organic Chemistry; from memory",
    example { "COC(=O)CCN1CCN(C(=O)OC(C)(C)C)CC1", from = { "C=CC(=O)OC", "CC(C)(C)OC(=O)N1CCNCC1" } },
    example { "COC(=O)CCN1CCCCC1", from = { "C=CC(=O)OC", "C1CCNCC1" } },
    refuse { "COC(=O)CN1CCCC1" }, -- amino group α to the ester: alkylation by a bromoacetate
}

disconnection "arbuzov" {
    about = "Arbuzov reaction; primary halides only",
    rxno = "RXNO:0000060",
    target = "[C;X4;H2:1]-!@[P;X4:2](=[O:3])([O:4][C;H2][C;H3])[O:5][C;H2][C;H3]",
    cut = { 1, 2 },
    acceptor = { 1, "alkyl" },
    donor = { 2, "phosphite" },
    conditions = "heat-200",
    also_attacks = { "other alkyl halide", "α-halo ketone", "acyl halide", "enone", "disulfide" },
    recipe = "neat P(OEt)3, 120-160 °C; also: alkyl chloride, iodide, trimethyl phosphite",
    yield = { 80, 97 },
    source = "Kürti and Czakó, Strategic Applications of Named Reactions in Organic Synthesis; from memory",
    example { "CCOP(=O)(Cc1ccc(C#N)cc1)OCC", from = { "N#Cc1ccc(CBr)cc1", "CCOP(OCC)OCC" } },
    example { "CCOP(=O)(Cc1ccccc1)OCC", from = { "BrCc1ccccc1", "CCOP(OCC)OCC" } },
    refuse { "CCOP(=O)(OCC)OCC" }, -- a phosphate, no C-P bond
}

disconnection "double-claisen-schmidt" {
    about = "Diarylideneacetone by double Claisen-Schmidt condensation; E,E",
    rxno = "RXNO:0000595",
    target = "[c:1][CX3;H1:2]=[CX3;H1:3][CX3:4](=[OX1:5])[CX3;H1:6]=[CX3;H1:7][c:8]",
    from = "[c:1][C:2]=O.[C;H3:3][C:4](=[O:5])[C;H3:6].O=[C:7][c:8]",
    when = function(m) return m.atom[1].symmetry == m.atom[8].symmetry end,
    conditions = "base-aq-mild",
    also_attacks = { "other aldehyde", "ketone", "ester", "acyl halide" },
    recipe = "aq. NaOH, EtOH, 20-25 °C, 2 equiv. of aldehyde",
    yield = { 75, 92 },
    cautions = { "sodium hydroxide" },
    source = "Vogel's Textbook of Practical Organic Chemistry; from memory",
    example { "COc1ccc(C=CC(=O)C=Cc2ccc(OC)cc2)cc1", from = { "COc1ccc(C=O)cc1", "CC(C)=O", "COc1ccc(C=O)cc1" } },
    example { "O=C(C=Cc1ccccc1)C=Cc1ccccc1", from = { "O=Cc1ccccc1", "CC(C)=O" } },
    refuse { "O=C(C=Cc1ccccc1)C=Cc1ccc(Cl)cc1" }, -- the two aryl groups are the same
}

interconversion "decarboxylation-keto-ester" {
    about = "Ketone from a β-keto ester (hydrolysis and decarboxylation); the ester may stand on either α carbon",
    target = "[#6:1]-[CX3;r5,r6,r7:2](=[OX1:3])-[CX4;H2;R:4]-[#6:5]",
    from = "[#6:1][C:2](=[O:3])[C:4](-[#6:5])C(=O)OCC",
    conditions = "acid-aq-strong",
    also_attacks = { "ester", "nitrile", "amide", "acid-labile acetal" },
    recipe = "6 M HCl, reflux, or NaOH, then acid, heat; also: tert-butyl ester with TFA",
    yield = { 75, 95 },
    source = "Clayden, Greeves, Warren, Organic Chemistry; from memory",
    example { "O=C1CCN(Cc2ccccc2)CC1", from = { "CCOC(=O)C1CN(Cc2ccccc2)CCC1=O" } },
    example { "O=C1CCCC1", from = { "CCOC(=O)C1CCCC1=O" } },
    refuse { "CC1(C)CCCC(C)(C)C1=O" }, -- no H on either α carbon
}

disconnection "glyoxylic-acid-hydroxyalkylation" {
    about = "Hydroxyalkylation of a phenol by glyoxylic acid; para to OH",
    target = "[c;$(c1ccc([OX2H1])cc1):1][C;X4;H1:2]([O;H1:3])[C;X3:4](=[O:5])[O;H1:6]",
    from = "[cH:1].[C;H1:2](=[O;H0:3])[C:4](=[O:5])[O:6]",
    conditions = "base-aq-strong",
    also_attacks = { "other phenol", "aldehyde", "primary amine", "thiol" },
    recipe = "aq. NaOH, 0-40 °C, then acid",
    yield = { 70, 88 },
    cautions = { "sodium hydroxide" },
    source = "Kleemann and Engel, Pharmaceutical Substances; from memory",
    example { "COc1cc(ccc1O)C(O)C(=O)O", from = { "COc1ccccc1O", "O=CC(=O)O" } },
    example { "OC(C(=O)O)c1ccc(O)cc1", from = { "Oc1ccccc1", "O=CC(=O)O" } },
    refuse { "OC(C(=O)O)c1ccccc1" }, -- no hydroxyl group on the ring
}

disconnection "bargellini" {
    about = "Bargellini reaction: aryloxyisobutyric acid; phenol before alcohol",
    target = "[c:1][O;X2:2]-[C;X4;H0:3]([C;H3:4])([C;H3:5])[C;X3:6](=O)[O;H1]",
    from = "[c:1][O;H1:2].[C:3](=O)([C:4])[C:5].[C;H1:6](Cl)(Cl)Cl",
    conditions = "base-aq-strong",
    also_attacks = { "aldehyde", "thiol", "primary amine", "other phenol" },
    recipe = "NaOH powder, acetone, chloroform, 0 °C to reflux",
    yield = { 60, 85 },
    cautions = { "chloroform", "sodium hydroxide" },
    source = "Kleemann and Engel, Pharmaceutical Substances; from memory",
    example { "CC(C)(Oc1ccc(cc1)C(=O)c1ccc(Cl)cc1)C(=O)O", from = { "Oc1ccc(cc1)C(=O)c1ccc(Cl)cc1", "CC(C)=O", "ClC(Cl)Cl" } },
    example { "CC(C)(Oc1ccc(Cl)cc1)C(=O)O", from = { "Oc1ccc(Cl)cc1", "CC(C)=O", "ClC(Cl)Cl" } },
    refuse { "CC(Oc1ccccc1)C(=O)O" }, -- only one methyl group: from 2-bromopropionate
}

disconnection "willgerodt-kindler" {
    about = "Willgerodt-Kindler reaction; sulfur ends at the last carbon of the chain",
    rxno = "RXNO:0000186",
    target = "[c:1][C;X4;H2:2][C;X3:3](=[S;X1])[N;X3:4]",
    from = "[c:1][C;H0:2](=O)[C;H3:3].[N;H1:4]",
    conditions = "amine-heat",
    also_attacks = { "nitro", "aldehyde", "alkene", "alkyl halide", "acyl halide", "ester" },
    recipe = "S8, morpholine, reflux (130 °C)",
    yield = { 60, 88 },
    cautions = { "hydrogen sulfide", "sulfur", "morpholine" },
    source = "Kürti and Czakó, Strategic Applications of Named Reactions in Organic Synthesis; from memory",
    example { "COc1ccc2cc(CC(=S)N3CCOCC3)ccc2c1", from = { "COc1ccc2cc(ccc2c1)C(C)=O", "C1COCCN1" } },
    example { "S=C(Cc1ccccc1)N1CCOCC1", from = { "CC(=O)c1ccccc1", "C1COCCN1" } },
    refuse { "CC(=S)N1CCOCC1" }, -- no aryl group on the chain
}

disconnection "robinson-granatanone" {
    about = "Pseudopelletierine synthesis (double Mannich reaction); loses two CO2",
    target = "[C;X4:1][N;X3:2]1[C;X4;H1:3]2[C;X4;H2:4][C;X4;H2:11][C;X4;H2:5][C;X4;H1:6]1[C;X4;H2:7][C;X3:8](=[O:9])[C;X4;H2:10]2",
    from = "[C:1][N;H2:2].[C;H1:3](=O)[C:4][C:11][C:5][C;H1:6]=O.[C;H2:7](C(=O)O)[C:8](=[O:9])[C;H2:10]C(=O)O",
    conditions = "acid-aq-mild",
    also_attacks = { "other aldehyde", "ketone", "primary amine" },
    recipe = "buffer pH 4-5, H2O, rt",
    yield = { 55, 75 },
    cautions = { "glutaraldehyde" },
    source = "Vogel's Textbook of Practical Organic Chemistry; from memory",
    example { "CN1C2CCCC1CC(=O)C2", from = { "CN", "O=CCCCC=O", "OC(=O)CC(=O)CC(=O)O" } },
    example { "O=C1CC2CCCC(C1)N2Cc1ccccc1", from = { "NCc1ccccc1", "O=CCCCC=O", "OC(=O)CC(=O)CC(=O)O" } },
    refuse { "CN1C2CCC1CC(=O)C2" }, -- tropane: needs succinaldehyde
}

disconnection "coumarin-perkin" {
    about = "Coumarin by Perkin condensation of a salicylaldehyde; E acid would not close; the Z adduct lactonises",
    rxno = "RXNO:0000003",
    target = "[o:1]1[c;$(c1ccccc1):2]:[c;$(c1ccccc1):3]:[cH:4]:[cH:5]:[c:6]1=[O:7]",
    from = "[O;H1:1]-[c:2]:[c:3]-[C;H1:4]=O.[C;H3:5][C:6](=[O:7])OC(C)=O",
    conditions = "heat-200",
    also_attacks = { "other phenol", "free alcohol", "primary amine", "other aldehyde" },
    recipe = "NaOAc, Ac2O, 160-180 °C",
    yield = { 45, 70 },
    cautions = { "acetic anhydride" },
    source = "Vogel's Textbook of Practical Organic Chemistry; from memory",
    example { "O=c1ccc2cc(Br)ccc2o1", from = { "O=Cc1cc(Br)ccc1O", "CC(=O)OC(C)=O" } },
    example { "O=c1ccc2ccccc2o1", from = { "O=Cc1ccccc1O", "CC(=O)OC(C)=O" } },
    refuse { "O=c1cccco1" }, -- a pyranone without benzo ring
}

interconversion "decarboxylation-malonic" {
    about = "Decarboxylation of a malonic acid; a new stereocentre is racemic",
    also = { "malonic-decarboxylation" },
    target = "[OX2H1:1]-[CX3:2](=[OX1:3])-[CX4;H1,H2;!$([C@H](*)(*)*);!$(C-[N;!$(N-C=O)]);!$(C-[OX2H1]);!$(C-[!#6;!#7;!#8;!#1]):4]-[CX4,c;!$(C(-[!#6;!#1])-[!#6;!#1]):5]",
    from = "[O:1][C:2](=[O:3])[C:4]([#6:5])C(=O)O",
    conditions = "heat-200",
    also_attacks = { "tert-butyl ester", "β-keto ester", "acid-labile acetal" },
    recipe = "neat or in pyridine or aq. HCl, 120-180 °C",
    yield = { 75, 95 },
    source = "Vogel's Textbook of Practical Organic Chemistry; from memory",
    example { "O=C(O)C1CCC1", from = { "O=C(O)C1(C(=O)O)CCC1" } },
    example { "CCCCCC(=O)O", from = { "CCCCC(C(=O)O)C(=O)O" } },
    refuse { "C[C@@H](Cc1ccccc1)C(=O)O" }, -- the centre comes out racemic
    refuse { "CC(C)(C)C(=O)O" }, -- no H left where the second carboxyl group stood
}

-- A benzoin splits into two aldehydes; only equal halves come without three others.
local benzoin_halves = rewrite "[c:1][C:2]([O:3])[C:4](=[O:5])[c:6]>>[c:1][C:2]=[O:3].[C:4](=[O:5])[c:6]"

disconnection "benzoin" {
    about = "Benzoin condensation; two equal aromatic aldehydes, one of them with its polarity inverted by cyanide",
    target = "[c:1]-[CX4;H1;!R:2]([OX2H1:3])-!@[CX3;!R:4](=[OX1:5])-[c:6]",
    from = "[c:1][C:2]=[O:3].[C:4](=[O:5])[c:6]",
    when = function(m)
        for _, halves in ipairs(benzoin_halves:apply(m.molecule)) do
            if halves[1] == halves[2] then return true end
        end
        return false
    end,
    conditions = "cyanide",
    also_attacks = { "other aldehyde", "alkyl halide", "acyl halide" },
    recipe = "NaCN (cat.), aq. EtOH, reflux; also: thiamine or a thiazolium salt, Et3N",
    yield = { 65, 92 },
    cautions = { "sodium cyanide" },
    source = "Adams, Marvel, Org. Synth. Coll. Vol. 1, 94; from memory",
    example { "O=C(c1ccco1)C(O)c1ccco1", from = { "O=Cc1ccco1", "O=Cc1ccco1" } },
    example { "O=C(c1ccccc1)C(O)c1ccccc1", from = { "O=Cc1ccccc1", "O=Cc1ccccc1" } },
    refuse { "O=C(c1ccccc1)C(O)c1ccco1" }, -- unequal halves would give four benzoins
}

disconnection "knoevenagel-ketone" {
    about = "Knoevenagel condensation of a ketone with a cyano ester, malononitrile or the like (Cope); mixture of E and Z",
    target = "[#6;$(c),$([CX4]):1][CX3;H0:2](-[#6;$(c),$([CX4]):6])=!@[CX3:3](-[#6;$([CX3](=O)[OX2][#6]),$([CX3](=O)[NX3]),$([CX2]#N):4])[CX2:5]#[NX1:7]",
    cut = { 2, 3 },
    acceptor = { 2, "alkylidene" },
    donor = { 3, "stabilised-carbanion" },
    conditions = "acid-hot-dry",
    also_attacks = { "aldehyde", "other ketone", "acyl halide", "primary amine" },
    recipe = "NH4OAc, AcOH, toluene, water removed; also: TiCl4, pyridine, 0 °C",
    yield = { 60, 85 },
    source = "Cope, Hofmann, Wyckoff, Hardenbergh, J. Am. Chem. Soc. 1941, 63, 3452; from memory",
    example { "CCOC(=O)C(C#N)=C1CCN(C(=O)OC(C)(C)C)CC1",
        from = { "O=C1CCN(C(=O)OC(C)(C)C)CC1", "CCOC(=O)CC#N" } },
    example { "CCOC(=O)C(C#N)=C(C)c1ccccc1", from = { "CC(=O)c1ccccc1", "CCOC(=O)CC#N" } },
    refuse { "COC(=O)C(C(=O)OC)=C(C)C" }, -- malonates need a stronger Lewis acid
}

disconnection "arylacrylonitrile-condensation" {
    about = "Condensation of an aromatic aldehyde with an arylacetonitrile or a 3-alkoxypropionitrile",
    target = "[c:1][CX3;H1;!R:2]=!@[CX3:3](-[$(c),$([CX4;H2][OX2;H0]):4])[CX2:5]#[NX1:6]",
    cut = { 2, 3 },
    acceptor = { 2, "alkylidene" },
    donor = { 3, "stabilised-carbanion" },
    conditions = "alkoxide",
    also_attacks = { "other aldehyde", "enolisable ketone", "alkyl halide", "acyl halide" },
    recipe = "NaOMe, MeOH, or KOH, EtOH, rt to reflux",
    yield = { 60, 90 },
    cautions = { "sodium methoxide" },
    source = "Stenbuck, Baltzly, Hood, J. Org. Chem. 1963, 28, 1983; from memory",
    example { "N#CC(=Cc1ccccc1)c1ccccc1", from = { "O=Cc1ccccc1", "N#CCc1ccccc1" } },
    example { "COCC(C#N)=Cc1cc(OC)c(OC)c(OC)c1", from = { "O=Cc1cc(OC)c(OC)c(OC)c1", "COCCC#N" } },
    refuse { "N#CC=Cc1ccccc1" }, -- acetonitrile is too weak an acid for these bases
}

disconnection "conjugate-cyanide-addition" {
    about = "Conjugate addition of cyanide to an alkylidene malonate, cyanoacetate or to an enone",
    target = "[CX4;!$(C[OX2H]):1](-!@[CX2:2]#[NX1:3])[CX4;H1,H2;$(C([CX3]=O)[$([CX3]=O),$(C#N)]),$(C[CX3](=O)[#6]):4]",
    from = "[C:1]=[C:4].[Na+].[C-:2]#[N:3]",
    conditions = "cyanide",
    also_attacks = { "aldehyde", "alkyl halide", "acyl halide", "epoxide", "other enone" },
    recipe = "NaCN or KCN, aq. EtOH, 0 °C to rt; ketones: KCN, NH4Cl, DMF, or Et2AlCN",
    yield = { 65, 90 },
    cautions = { "sodium cyanide", "hydrogen cyanide" },
    source = "Higson, Thorpe, J. Chem. Soc., Trans. 1906, 89, 1455; from memory",
    example { "CCOC(=O)C(C#N)C(C)(CC)C#N", from = { "CCOC(=O)C(C#N)=C(C)CC", "[Na+].[C-]#N" } },
    example { "N#CC(CC(=O)c1ccccc1)c1ccccc1", from = { "O=C(C=Cc1ccccc1)c1ccccc1", "[Na+].[C-]#N" } },
    refuse { "CCOC(=O)CC(C)C#N" }, -- a simple unsaturated ester is too poor an acceptor
}

interconversion "glycidic-ester-to-aldehyde" {
    about = "Aldehyde from a glycidic ester by saponification and loss of carbon dioxide (after Darzens)",
    target = "[#6;!$([#6]=[O,N,S]);!$([#6]#N):1][CX4;H1,H2;!$(C[!#6;!#1]);!$(C([CX3]=O)[CX3]=O):2][CX3;H1:3]=[OX1:4]",
    from = "[#6:1][C:2]1[O:4][C:3]1C(=O)OCC",
    conditions = "base-aq-strong",
    also_attacks = { "other ester", "aldehyde", "acyl halide", "alkyl halide" },
    recipe = "NaOEt, then water, or NaOH, aq. EtOH; acid, 60-100 °C (CO2 leaves)",
    yield = { 55, 80 },
    cautions = { "sodium hydroxide" },
    source = "Allen, Van Allan, Org. Synth. Coll. Vol. 3, 733 (hydratropaldehyde); from memory",
    example { "CC(C)Cc1ccc(C(C)C=O)cc1", from = { "CCOC(=O)C1OC1(C)c1ccc(CC(C)C)cc1" } },
    example { "CC(C=O)c1ccccc1", from = { "CCOC(=O)C1OC1(C)c1ccccc1" } },
    refuse { "CC(C)(C=O)c1ccccc1" }, -- no hydrogen where the enol has to close
}
