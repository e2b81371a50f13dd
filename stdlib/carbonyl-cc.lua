-- Carbon-carbon bonds made with enolates, ylides and cyanide.
-- Yields are typical ranges and sources stand from memory unless a source says otherwise.

pack {
    name = "carbonyl-cc",
    version = "0.1.0",
    licence = "CC0-1.0",
    about = "Carbon-carbon bonds made with enolates, ylides and cyanide",
    needs = { "synthons" },
}

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
    refuse { "CC(C)C(O)CC(=O)OC" }, -- an ester: Reformatsky or ester enolate
}

disconnection "claisen-schmidt" {
    about = "Claisen-Schmidt condensation; E alkene",
    rxno = "RXNO:0000595",
    target = "[c:1]/[CX3;H1;!R:2]=[CX3;H1;!R:3]/[CX3;$(C([#6])[#6]):4]=[OX1:5]",
    cut = { 2, 3 },
    acceptor = { 2, "alkylidene" },
    donor = { 3, "enolate" },
    conditions = "base-aq-mild",
    also_attacks = { "aldehyde", "ketone", "acyl halide", "activated ester" },
    recipe = "NaOH or KOH, EtOH/H2O, 0 °C to rt; also: Ba(OH)2, acid (HCl)",
    yield = { 70, 95 },
    source = "Vogel's Textbook of Practical Organic Chemistry; from memory",
    example { "COc1ccc(/C=C/C(=O)c2ccncc2)cc1", from = { "COc1ccc(C=O)cc1", "CC(=O)c1ccncc1" } },
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
    refuse { "CCOC(=O)C=Cc1ccccc1" }, -- only one electron-withdrawing group: Horner-Wadsworth-Emmons or Doebner
}

disconnection "doebner" {
    about = "Doebner reaction; E alkene",
    rxno = "RXNO:0000126",
    target = "[#6;$(c),$([CX4]):1]/[CX3;H1;!R:2]=[CX3;H1;!R:3]/[CX3:4](=[OX1:5])-[OX2H1:6]",
    from = "[#6:1][C:2]=O.[C:3]([C:4](=[O:5])[O:6])C(=O)O",
    conditions = "base-aq-mild",
    also_attacks = { "other aldehyde", "acyl halide" },
    recipe = "pyridine, piperidine cat., 80-110 °C, loss of CO2",
    yield = { 70, 95 },
    cautions = { "pyridine" },
    source = "Vogel's Textbook of Practical Organic Chemistry; from memory",
    example { "COc1cc(/C=C/C(=O)O)ccc1O", from = { "COc1cc(C=O)ccc1O", "O=C(O)CC(=O)O" } },
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
    refuse { "COC(=O)CCCC(=O)OC" }, -- the donor carbon bears only one activating group
}

disconnection "perkin" {
    about = "Perkin reaction; E alkene",
    rxno = "RXNO:0000003",
    target = "[c:1]/[CX3;H1;!R:2]=[CX3;H1;!R:3]/[CX3:4](=[OX1:5])-[OX2H1:6]",
    from = "[c:1][C:2]=O.[C:3][C:4](=[O:5])[O:6]C(C)=O",
    conditions = "heat-200",
    also_attacks = { "free alcohol", "phenol", "primary amine", "secondary amine" },
    recipe = "NaOAc, Ac2O, 140-180 °C",
    yield = { 45, 80 },
    cautions = { "acetic anhydride" },
    source = "Vogel's Textbook of Practical Organic Chemistry; from memory",
    example { "O=C(O)/C=C/c1ccc([N+](=O)[O-])cc1", from = { "O=Cc1ccc([N+](=O)[O-])cc1", "CC(=O)OC(C)=O" } },
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
    refuse { "CC1OC1CO" }, -- no ester at the epoxide
}

disconnection "malonic-ester-synthesis" {
    about = "Malonic ester synthesis; SN2; two carbons added, ester hydrolysed and CO2 lost at the end",
    rxno = "RXNO:0000107",
    target = "[OX2H1:1]-[CX3:2](=[OX1:3])-[CX4;H2:4]-!@[CX4;H2,H3;!$(C-[O,N,S,F,Cl,Br,I]);!$([CX4][CX4]([CX4])([CX4])[CX4]):5]",
    from = "[O:1](CC)[C:2](=[O:3])[C:4]C(=O)OCC.Br[C:5]",
    conditions = "alkoxide",
    also_attacks = { "alkyl halide", "aldehyde", "acyl halide", "epoxide", "ester" },
    recipe = "NaOEt, EtOH, reflux; KOH; aq. HCl, reflux; also: I, OTs",
    yield = { 55, 80 },
    cautions = { "sodium ethoxide" },
    source = "Clayden, Greeves, Warren, Organic Chemistry; from memory",
    example { "O=C(O)CCc1ccc2c(c1)OCO2", from = { "CCOC(=O)CC(=O)OCC", "BrCc1ccc2c(c1)OCO2" } },
    refuse { "O=C(O)CC(C)(C)C" }, -- a tertiary halide eliminates
}

disconnection "active-methylene-alkylation" {
    about = "Alkylation of a malonate, acetoacetate or cyanoacetate; C-alkylation; dialkylation is the rival where H remains",
    target = "[CX4;H0,H1;$(C([CX3](=O)[O,#6])[CX3](=O)[O,#6]),$(C([CX3](=O)[O,#6])C#N):1]-!@[CX4;H2,H3;!$(C-[O,N,S,F,Cl,Br,I]);!$([CX4][CX4]([CX4])([CX4])[CX4]):2]",
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
    refuse { "CCCC/C=C/CCCCO" }, -- the E alkene: Julia-Kocienski or Schlosser's variant
}

disconnection "wittig-stabilised" {
    about = "Wittig reaction with a stabilised ylide; E alkene; aldehydes only",
    rxno = "RXNO:0000015",
    target = "[#6:1]/[CX3;H1;!R:2]=[CX3;!R:3]/[CX3;$(C(=O)([#6])[#6]),$(C(=O)[OX2][#6]),H1:4]=[OX1:5]",
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
    refuse { "C=C(OC)c1ccccc1" }, -- an enol ether from an ester: Tebbe or Petasis reagent
}

disconnection "hwe-e" {
    about = "Horner-Wadsworth-Emmons reaction; E alkene",
    rxno = "RXNO:0000056",
    target = "[#6:1]/[CX3;H1;!R:2]=[CX3;!R:3]/[#6;$([CX3](=O)([#6])[#6]),$([CX3](=O)[OX2][#6]),$([CX3](=O)[NX3]),$([CX2]#N):4]",
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
    refuse { "CCOC(=O)/C=C\\C" }, -- the Z ester: Still-Gennari
}

disconnection "hwe-benzylic" {
    about = "Horner-Wadsworth-Emmons reaction of a benzylic phosphonate (E-stilbene); E",
    rxno = "RXNO:0000056",
    target = "[c:1]/[C;X3;H1;!R:2]=[C;X3;H1;!R:3]/[c:4]",
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
    refuse { "O=c1cccco1" }, -- a pyranone without benzo ring
}

interconversion "decarboxylation-malonic" {
    about = "Decarboxylation of a malonic acid; a new stereocentre is racemic",
    also = { "malonic-decarboxylation" },
    target = "[OX2H1:1]-[CX3:2](=[OX1:3])-[CX4;H1,H2:4]-[#6;!$(C(=O)[OX2H1]):5]",
    from = "[O:1][C:2](=[O:3])[C:4]([#6:5])C(=O)O",
    conditions = "heat-200",
    also_attacks = { "tert-butyl ester", "β-keto ester", "acid-labile acetal" },
    recipe = "neat or in pyridine or aq. HCl, 120-180 °C",
    yield = { 75, 95 },
    source = "Vogel's Textbook of Practical Organic Chemistry; from memory",
    example { "O=C(O)C1CCC1", from = { "O=C(O)C1(C(=O)O)CCC1" } },
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
