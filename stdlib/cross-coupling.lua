-- Palladium-catalysed couplings.
-- Yields are typical ranges and sources stand from memory unless a source says otherwise.

pack {
    name = "cross-coupling",
    version = "0.1.0",
    licence = "CC0-1.0",
    about = "Palladium-catalysed couplings",
    needs = { "synthons" },
}

disconnection "suzuki-biaryl" {
    about = "Suzuki coupling of an aryl bromide, biaryl; ipso at both partners",
    rxno = "RXNO:0000634",
    target = "[c;!$(c1nnnn1):1]-!@[c;!$(c:[nX2]);!$(c1:[o,s]:c:c:[n]:1);!$(c1nnnn1):2]",
    cut = { 1, 2 },
    acceptor = { 1, "aryl-halide" },
    donor = { 2, "organoboron" },
    conditions = "pd0",
    also_attacks = { "aryl bromide", "aryl iodide", "aryl triflate", "vinyl halide", "allylic ester",
        "acyl halide" },
    recipe = "Pd(PPh3)4 or Pd(dppf)Cl2, K2CO3 or Na2CO3, dioxane/H2O, 80-100 °C; also: I, OTf, Cl (SPhos); BPin, BF3K",
    yield = { 70, 95 },
    source = "Miyaura, Suzuki, Chem. Rev. 1995, 95, 2457; from memory",
    example { "O=Cc1ccc(-c2cccnc2)cc1", from = { "Brc1cccnc1", "O=Cc1ccc(B(O)O)cc1" } },
    refuse { "c1ccc(-c2ccccn2)nc1" }, -- 2-pyridylboronic acids lose boron: Negishi or Stille
}

disconnection "sonogashira" {
    about = "Sonogashira coupling; ipso; iodide before bromide",
    rxno = "RXNO:0000579",
    target = "[c:1]-[CX2:2]#[CX2:3]-[#6,Si:4]",
    cut = { 1, 2 },
    acceptor = { 1, "aryl-halide" },
    donor = { 2, "acetylide" },
    conditions = "pd0",
    also_attacks = { "aryl bromide", "aryl iodide", "aryl triflate", "vinyl halide", "allylic ester",
        "acyl halide", "other terminal alkyne" },
    recipe = "PdCl2(PPh3)2, CuI, Et3N, THF, rt (I) or 60-80 °C (Br); also: Br, OTf",
    yield = { 75, 95 },
    source = "Carey, Sundberg, Advanced Organic Chemistry Part B; from memory",
    example { "CC(C)(O)C#Cc1cccc(N)c1", from = { "Nc1cccc(I)c1", "C#CC(C)(C)O" } },
    refuse { "CCCC#CCc1ccccc1" }, -- no bond between arene and alkyne
}

disconnection "heck-acrylate" {
    about = "Heck reaction with an electron-poor alkene; β carbon of the acceptor, E",
    rxno = "RXNO:0000024",
    target = "[c:1]/[CX3;H1;!R:2]=[CX3;H1;!R:3]/[#6;$([CX3](=O)([#6])[#6]),$([CX3](=O)[OX2][#6]),$([CX3](=O)[NX3]),$([CX2]#N):4]",
    cut = { 1, 2 },
    acceptor = { 1, "aryl-halide" },
    donor = { 2, "alkene" },
    conditions = "pd0",
    also_attacks = { "aryl bromide", "aryl iodide", "aryl triflate", "vinyl halide", "allylic ester",
        "other terminal alkene" },
    recipe = "Pd(OAc)2, P(o-tol)3, Et3N, DMF or MeCN, 80-120 °C; also: I, OTf",
    yield = { 65, 95 },
    source = "Carey, Sundberg, Advanced Organic Chemistry Part B; from memory",
    example { "CCCCOC(=O)/C=C/c1ccc(C=O)cc1", from = { "O=Cc1ccc(Br)cc1", "C=CC(=O)OCCCC" } },
    refuse { "COC(=O)/C=C\\c1ccccc1" }, -- the Z alkene is not formed
}

disconnection "buchwald-amine" {
    about = "Buchwald-Hartwig amination; ipso; primary amines once",
    rxno = "RXNO:0000192",
    target = "[c:1]-!@[NX3;H0,H1;+0;$(N(-c)-[#6]);!$(N-[C,S]=[O,N,S]);!$(N-C#N):2]",
    cut = { 1, 2 },
    acceptor = { 1, "aryl-halide" },
    donor = { 2, "amine" },
    conditions = "pd0",
    also_attacks = { "aryl bromide", "aryl iodide", "aryl triflate", "vinyl halide", "allylic ester",
        "aryl chloride", "acyl halide", "aldehyde", "other primary amine" },
    recipe = "Pd2(dba)3, BINAP or XPhos or RuPhos, NaOtBu or Cs2CO3, toluene, 80-110 °C; also: I, OTf, Cl",
    yield = { 70, 95 },
    cautions = { "sodium tert-butoxide" },
    source = "Carey, Sundberg, Advanced Organic Chemistry Part B; from memory",
    example { "COc1ccccc1N1CCN(C(=O)OC(C)(C)C)CC1", from = { "COc1ccccc1Br", "CC(C)(C)OC(=O)N1CCNCC1" } },
    refuse { "CC(=O)Nc1ccccc1" }, -- an amide nitrogen: Goldberg or amide coupling
}
