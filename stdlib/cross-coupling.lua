-- Palladium-catalysed couplings.
-- Yields are typical ranges and sources stand from memory unless a source says otherwise.

pack {
    name = "cross-coupling",
    version = "0.1.0",
    licence = "CC0-1.0",
    about = "Palladium-catalysed couplings",
    needs = { "synthons" },
}

-- What quenches an organozinc compound or a Grignard reagent, and what else a Grignard reagent attacks.
local PROTIC = pattern "[$([OX2H]),$([NX3;H1,H2;+0;!$(N-[C,S]=O)]),$([nH]),$([SX2H])]"
local ELECTROPHILIC =
    pattern "[$([NX3;H1]),$([CX3]=[O,N,S]),$([CX2]#N),$([N+](=O)[O-]),$([#16]=O),$([CX2]#[CX2;H1]),Br,I,$([OX2;r3])]"
local function suits_grignard(m)
    return not m.molecule:has(PROTIC) and not m.molecule:has(ELECTROPHILIC)
end

disconnection "suzuki-biaryl" {
    about = "Suzuki coupling of an aryl bromide, biaryl; ipso at both partners",
    rxno = "RXNO:0000634",
    target = "[c;!$(c1nnnn1):1]-!@[c;!$(c:[nX2]);!$(c1:[o,s]:c:c:[n]:1);!$(c1nnnn1):2]",
    cut = { 1, 2 },
    acceptor = { 1, "aryl-iodide" },
    donor = { 2, "organoboron" },
    conditions = "pd0",
    also_attacks = { "aryl bromide", "aryl iodide", "aryl triflate", "vinyl halide", "allylic ester",
        "acyl halide" },
    recipe = "Pd(PPh3)4 or Pd(dppf)Cl2, K2CO3 or Na2CO3, dioxane/H2O, 80-100 °C; also: I, OTf; BPin, BF3K",
    yield = { 70, 95 },
    source = "Miyaura, Suzuki, Chem. Rev. 1995, 95, 2457; from memory",
    example { "O=Cc1ccc(-c2cccnc2)cc1", from = { "Brc1cccnc1", "O=Cc1ccc(B(O)O)cc1" } },
    example { "Cc1ccc(cc1)-c1ccccc1", from = { "Brc1ccccc1", "Cc1ccc(B(O)O)cc1" } },
    refuse { "c1ccc(-c2ccccn2)nc1" }, -- 2-pyridylboronic acids lose boron: Negishi or Stille
}

disconnection "suzuki-biaryl-chloride" {
    about = "Suzuki coupling of an aryl chloride, biaryl; ipso at both partners",
    rxno = "RXNO:0000634",
    target = "[c;!$(c1nnnn1):1]-!@[c;!$(c:[nX2]);!$(c1:[o,s]:c:c:[n]:1);!$(c1nnnn1):2]",
    cut = { 1, 2 },
    acceptor = { 1, "aryl-chloride" },
    donor = { 2, "organoboron" },
    conditions = "pd0",
    also_attacks = { "other aryl chloride", "aryl bromide", "aryl iodide", "aryl triflate", "vinyl halide",
        "allylic ester", "acyl halide" },
    recipe = "Pd(OAc)2, SPhos or XPhos, K3PO4, toluene or dioxane/H2O, 80-100 °C; also: BPin, BF3K",
    yield = { 60, 90 },
    source = "Miyaura, Suzuki, Chem. Rev. 1995, 95, 2457; from memory",
    example { "O=Cc1ccc(-c2cccnc2)cc1", from = { "Clc1cccnc1", "O=Cc1ccc(B(O)O)cc1" } },
    example { "Cc1ccc(cc1)-c1ccccc1", from = { "Clc1ccccc1", "Cc1ccc(B(O)O)cc1" } },
    refuse { "c1ccc(-c2ccccn2)nc1" }, -- 2-pyridylboronic acids lose boron: Negishi or Stille
}

disconnection "suzuki-aryl-vinyl" {
    about = "Suzuki coupling of an aryl bromide and an alkenylboronic acid; retention of the alkene geometry",
    rxno = "RXNO:0000635",
    target = "[c:1]/[CX3;H1;!R:2]=[CX3;H1;!R:3]/[#6;!$([#6]=[O,N]):4]",
    cut = { 1, 2 },
    acceptor = { 1, "aryl-halide" },
    donor = { 2, "organoboron" },
    conditions = "pd0",
    also_attacks = { "aryl bromide", "aryl iodide", "aryl triflate", "vinyl halide", "allylic ester",
        "acyl halide" },
    recipe = "Pd(PPh3)4, K2CO3 or NaOEt, dioxane/H2O, 80 °C; also: I, OTf; BPin, BF3K",
    yield = { 70, 95 },
    source = "Miyaura, Suzuki, Chem. Rev. 1995, 95, 2457; from memory",
    example { "CCCC/C=C/c1ccc(C(C)=O)cc1", from = { "CC(=O)c1ccc(Br)cc1", "CCCC/C=C/B(O)O" } },
    example { "CCCC/C=C/c1ccccc1", from = { "Brc1ccccc1", "CCCC/C=C/B(O)O" } },
    refuse { "CCCC/C=C\\c1ccccc1" }, -- the E boronic acid gives the E alkene
}

disconnection "suzuki-alkyl-bbn" {
    about = "Hydroboration and B-alkyl Suzuki coupling; boron at the terminal carbon, coupling there",
    rxno = "RXNO:0000635",
    target = "[c:1]-!@[CX4;H2;!R:2]-[CX4;H2;!R;!$(C-[O,N,S,F,Cl,Br,I]):3]-[#6;!$([#6]=[O,N]);!$(C#N):4]",
    from = "[c:1]Br.[C:2]=[C:3]-[#6:4]",
    conditions = "pd0",
    also_attacks = { "aryl bromide", "aryl iodide", "aryl triflate", "vinyl halide", "allylic ester",
        "aldehyde", "ketone", "other alkene", "alkyne" },
    recipe = "9-BBN, THF, rt; then Pd(dppf)Cl2, K3PO4 or NaOH, 60 °C; also: I, OTf",
    yield = { 65, 90 },
    cautions = { "9-borabicyclo[3.3.1]nonane" },
    source = "Miyaura, Suzuki, Chem. Rev. 1995, 95, 2457; from memory",
    example { "COC(=O)c1ccc(CCCCC#N)cc1", from = { "COC(=O)c1ccc(Br)cc1", "C=CCCC#N" } },
    example { "CCCCCCc1ccccc1", from = { "Brc1ccccc1", "C=CCCCC" } },
    refuse { "CC(C)c1ccccc1" }, -- a secondary centre at the arene: the borane adds at the end of the alkene
}

disconnection "negishi-alkyl" {
    about = "Negishi coupling with an alkylzinc; no β-hydride shift with primary zinc reagents; ester and " ..
        "nitrile stand",
    rxno = "RXNO:0000088",
    target = "[c:1]-!@[CX4;H2:2]-[#6;!$([#6]-[F,Cl,Br,I]);!$([#6]=[O,N,S]);!$(C#N);!$([CX4]-[O,N,S]):3]",
    cut = { 1, 2 },
    acceptor = { 1, "aryl-halide" },
    donor = { 2, "organozinc" },
    when = function(m) return not m.molecule:has(PROTIC) end,
    conditions = "pd0",
    also_attacks = { "aryl bromide", "aryl iodide", "aryl triflate", "vinyl halide", "allylic ester",
        "free alcohol", "free acid", "aldehyde", "acyl halide" },
    recipe = "Pd(PPh3)4 or Pd(OAc)2/SPhos, THF, 25-60 °C; also: I, OTf, Cl",
    yield = { 65, 90 },
    cautions = { "organozinc halide" },
    source = "Carey, Sundberg, Advanced Organic Chemistry Part B; from memory",
    example { "CCOC(=O)CCCc1ccccn1", from = { "Brc1ccccn1", "CCOC(=O)CCC[Zn]Br" } },
    example { "c1ccc(cc1)Cc1ccccn1", from = { "Brc1ccccn1", "Br[Zn]Cc1ccccc1" } },
    refuse { "CCC(C)(C)c1ccccc1" }, -- a tertiary alkylzinc isomerises
    refuse { "OC(=O)CCCc1ccccn1" }, -- a free acid quenches the zinc reagent
}

disconnection "negishi-heterobiaryl" {
    about = "Negishi coupling of a 2-azinylzinc; ipso",
    rxno = "RXNO:0000088",
    target = "[c;$(c:[nX2]);!$(c1nnnn1):1]-!@[c;!$(c1nnnn1):2]",
    cut = { 2, 1 },
    acceptor = { 2, "aryl-halide" },
    donor = { 1, "organozinc" },
    conditions = "pd0",
    also_attacks = { "aryl bromide", "aryl iodide", "aryl triflate", "vinyl halide", "allylic ester",
        "free alcohol", "free acid", "aldehyde", "acyl halide" },
    recipe = "Pd(PPh3)4, THF, 25-60 °C; also: I, OTf",
    yield = { 60, 90 },
    cautions = { "organozinc halide" },
    source = "Carey, Sundberg, Advanced Organic Chemistry Part B; from memory",
    example { "CCOC(=O)c1ccc(-c2ccccn2)cc1", from = { "Br[Zn]c1ccccn1", "CCOC(=O)c1ccc(Br)cc1" } },
    example { "c1ccc(nc1)-c1ccccc1", from = { "Br[Zn]c1ccccn1", "Brc1ccccc1" } },
    refuse { "c1ccc(-c2ccccc2)cc1" }, -- no nitrogen next to the bond: Suzuki is simpler
}

interconversion "organozinc" {
    about = "Organozinc halide from a bromide; configuration at an sp3 carbon is lost",
    target = "[#6;!$([CX2]);!$([#6]-[O,N,F,Cl,Br,I]):1]-[Zn]Br",
    from = "[#6:1]Br",
    conditions = "grignard",
    also_attacks = { "free alcohol", "free acid", "aldehyde", "nitro", "epoxide", "other alkyl iodide" },
    recipe = "Zn (I2 or TMSCl activation), LiCl, THF or DMA, 25-70 °C; also: I",
    yield = { 75, 95 },
    cautions = { "zinc dust" },
    source = "Carey, Sundberg, Advanced Organic Chemistry Part B; from memory",
    example { "CCOC(=O)CCC[Zn]Br", from = { "CCOC(=O)CCCBr" } },
    example { "CCOC(=O)CCCC[Zn]Br", from = { "CCOC(=O)CCCCBr" } },
    refuse { "[Zn]C" }, -- not a zinc halide with a bromine
}

disconnection "stille-vinyl" {
    about = "Stille vinylation; retention of alkene geometry",
    rxno = "RXNO:0000035",
    target = "[c:1]-!@[CX3;H1:2]=[CX3;H2:3]",
    cut = { 1, 2 },
    acceptor = { 1, "aryl-halide" },
    donor = { 2, "organotin" },
    conditions = "pd0",
    also_attacks = { "aryl bromide", "aryl iodide", "aryl triflate", "vinyl halide", "allylic ester",
        "acyl halide" },
    recipe = "Pd(PPh3)4, toluene, 100 °C; LiCl with triflates; CuI/CsF; also: I, OTf",
    yield = { 65, 90 },
    cautions = { "organotin compounds" },
    source = "Carey, Sundberg, Advanced Organic Chemistry Part B; from memory",
    example { "C=Cc1cc(C=O)ccc1OC", from = { "COc1ccc(C=O)cc1Br", "C=C[Sn](CCCC)(CCCC)CCCC" } },
    example { "C=Cc1ccccc1", from = { "Brc1ccccc1", "C=C[Sn](CCCC)(CCCC)CCCC" } },
    refuse { "C=CCc1ccccc1" }, -- allyl, not vinyl on the arene
}

disconnection "stille-heteroaryl" {
    about = "Stille coupling of a heteroarylstannane; ipso; aldehydes stand",
    rxno = "RXNO:0000035",
    target = "[c;$(c1:[o,s]:c:c:c:1),$(c:[nX2]);!$(c1nnnn1):1]-!@[c;!$(c1nnnn1):2]",
    cut = { 2, 1 },
    acceptor = { 2, "aryl-halide" },
    donor = { 1, "organotin" },
    conditions = "pd0",
    also_attacks = { "aryl bromide", "aryl iodide", "aryl triflate", "vinyl halide", "allylic ester",
        "acyl halide" },
    recipe = "Pd(PPh3)4, toluene or DMF, 100 °C, CuI; also: I, OTf",
    yield = { 60, 90 },
    cautions = { "organotin compounds" },
    source = "Carey, Sundberg, Advanced Organic Chemistry Part B; from memory",
    example { "O=Cc1ccc(-c2ccco2)cc1", from = { "CCCC[Sn](CCCC)(CCCC)c1ccco1", "O=Cc1ccc(Br)cc1" } },
    example { "c1ccc(cc1)-c1cccs1", from = { "CCCC[Sn](CCCC)(CCCC)c1cccs1", "Brc1ccccc1" } },
    refuse { "c1ccc(-c2ccccc2)cc1" }, -- two carbocycles: Suzuki, no need for tin
}

disconnection "heck-styrene" {
    about = "Heck reaction with a styrene; terminal carbon, E",
    rxno = "RXNO:0000024",
    target = "[c:1]/[CX3;H1;!R:2]=[CX3;H1;!R:3]/[c:4]",
    cut = { 1, 2 },
    acceptor = { 1, "aryl-halide" },
    donor = { 2, "alkene" },
    conditions = "pd0",
    also_attacks = { "aryl bromide", "aryl iodide", "aryl triflate", "vinyl halide", "allylic ester",
        "other terminal alkene" },
    recipe = "Pd(OAc)2, P(o-tol)3, Et3N, DMF, 100-120 °C; also: I, OTf",
    yield = { 60, 90 },
    source = "Carey, Sundberg, Advanced Organic Chemistry Part B; from memory",
    example { "COc1cc(OC)cc(/C=C/c2ccc(OC(C)=O)cc2)c1", from = { "COc1cc(Br)cc(OC)c1", "C=Cc1ccc(OC(C)=O)cc1" } },
    example { "c1ccc(cc1)/C=C/c1ccccc1", from = { "Brc1ccccc1", "C=Cc1ccccc1" } },
    refuse { "c1ccc(/C=C\\c2ccccc2)cc1" }, -- the Z stilbene is not formed
}

disconnection "kumada" {
    about = "Kumada coupling (nickel); ipso; secondary groups may isomerise",
    rxno = "RXNO:0000542",
    target = "[c;!$(c1nnnn1);!$(c:o):1]-!@[#6;#6;!$([#6]=[O,N,S]);!$([#6]#[N,C]);!$([#6]-[O,N,S,F,Cl,Br,I]);!$([CX4]-[CX4]-[OX2,NX3,n,F,Cl,Br,I]);!$([CX4]-[CX2]#N);!$([CX4]~[#7+]);!$([CX4]-n);!$([CX4]-[CX4]-[CX3]=[OX1]);!$([CX4](-[#6]=[O,N,S])-[#6]=[O,N,S]);$([CX4;H2,H3]),$([CX4;H1;R]([CX4])[CX4]),$(c1ccccc1),$(c1cccs1):2]",
    cut = { 1, 2 },
    acceptor = { 1, "aryl-halide" },
    donor = { 2, "organomagnesium" },
    when = function(m) return suits_grignard(m) end,
    conditions = "grignard",
    also_attacks = { "free alcohol", "free acid", "primary amine", "secondary amine", "aldehyde", "ketone",
        "ester", "nitrile", "acyl halide", "epoxide", "nitro", "terminal alkyne", "aryl bromide" },
    recipe = "NiCl2(dppp), Et2O or THF, 0 °C to reflux; also: Br, OTf",
    yield = { 65, 90 },
    cautions = { "magnesium alkyl halide", "nickel salts" },
    source = "Carey, Sundberg, Advanced Organic Chemistry Part B; from memory",
    example { "CCCCc1cccc(C2OCCO2)c1", from = { "Clc1cccc(C2OCCO2)c1", "CCCC[Mg]Br" } },
    example { "CCCCc1ccccc1", from = { "Clc1ccccc1", "CCCC[Mg]Br" } },
    refuse { "CC(C)(C)c1ccccc1" }, -- tertiary Grignard reagents do not couple so
    refuse { "CCCCc1ccc(cc1)C(C)=O" }, -- a ketone takes the Grignard reagent
}

disconnection "buchwald-ammonia" {
    about = "Aniline from an aryl bromide and benzophenone imine; ipso, single arylation",
    rxno = "RXNO:0000192",
    target = "[c:1]-[NX3;H2;+0:2]",
    from = "[c:1]Br.[N:2]=C(c1ccccc1)c1ccccc1",
    conditions = "pd0",
    also_attacks = { "aryl bromide", "aryl iodide", "aryl triflate", "vinyl halide", "allylic ester",
        "acyl halide", "aldehyde" },
    recipe = "Pd2(dba)3, BINAP, NaOtBu, toluene, 80-100 °C; then aq. HCl; also: I, OTf; BocNH2",
    yield = { 70, 90 },
    cautions = { "sodium tert-butoxide" },
    source = "Carey, Sundberg, Advanced Organic Chemistry Part B; from memory",
    example { "Nc1cnc2ccccc2c1", from = { "Brc1cnc2ccccc2c1", "N=C(c1ccccc1)c1ccccc1" } },
    example { "Nc1ccccc1", from = { "Brc1ccccc1", "N=C(c1ccccc1)c1ccccc1" } },
    refuse { "NCc1ccccc1" }, -- amino group not on the ring
}

disconnection "goldberg-amide" {
    about = "Goldberg N-arylation of an amide; lactams and primary amides best",
    rxno = "RXNO:0000082",
    target = "[c:1]-!@[NX3;+0;$([N;R]-[CX3;R]=[OX1]),$([N;H1]-[CX3](=[OX1])[#6]);!$(N(-[CX3]=[OX1])-[CX3]=[OX1]);!$([N;H1]-c1ccccc1):2]-[CX3:3]=[OX1:4]",
    cut = { 1, 2 },
    acceptor = { 1, "aryl-halide" },
    donor = { 2, "amide-nitrogen" },
    conditions = "cu",
    also_attacks = { "other aryl iodide", "other aryl bromide", "primary amine", "acyl halide" },
    recipe = "CuI, N,N'-dimethylethylenediamine, K3PO4 or K2CO3, toluene or dioxane, 100 °C; also: I; Pd/Xantphos",
    yield = { 70, 95 },
    source = "Carey, Sundberg, Advanced Organic Chemistry Part B; from memory",
    example { "COc1ccc(N2CCCC2=O)cc1", from = { "COc1ccc(Br)cc1", "O=C1CCCN1" } },
    example { "O=C1CCCN1c1ccccc1", from = { "Ic1ccccc1", "O=C1CCCN1" } },
    refuse { "O=C1CCC(=O)N1c1ccccc1" }, -- an imide is not nucleophilic enough and opens
    refuse { "CC(=O)Nc1ccccc1" }, -- an anilide: acylate the aniline
}

disconnection "buchwald-ether" {
    about = "Palladium-catalysed aryl ether synthesis; ipso; β-hydride elimination of the alkoxide is the rival",
    target = "[c:1]-!@[OX2:2]-[CX4;H1,H2;!$(C(O)[O,N,S,F,Cl,Br]);!$(C-C=O);!$(C-C#N):3]",
    cut = { 1, 2 },
    acceptor = { 1, "aryl-iodide" },
    donor = { 2, "alcohol" },
    conditions = "pd0",
    also_attacks = { "free acid", "amidine", "other phenol", "primary amide", "aryl bromide", "aryl iodide", "aryl triflate", "vinyl halide", "allylic ester",
        "other free alcohol", "primary amine", "acyl halide" },
    recipe = "Pd(OAc)2, bulky biaryl phosphine (RockPhos), Cs2CO3, toluene, 90 °C; CuI, phenanthroline; also: Cl, I",
    yield = { 60, 85 },
    source = "Carey, Sundberg, Advanced Organic Chemistry Part B; from memory",
    example { "COc1ccc(OC2CCCC2)cc1", from = { "COc1ccc(Br)cc1", "OC1CCCC1" } },
    example { "CCOc1ccccc1", from = { "Brc1ccccc1", "CCO" } },
    refuse { "CC(C)(C)OC(=O)c1ccccc1" }, -- an ester oxygen, not on the ring
}

disconnection "ullmann-ether" {
    about = "Ullmann diaryl ether synthesis; ipso",
    rxno = "RXNO:0000081",
    target = "[c:1]-!@[OX2:2]-[c:3]",
    cut = { 1, 2 },
    acceptor = { 1, "aryl-iodide" },
    donor = { 2, "phenol" },
    conditions = "cu",
    also_attacks = { "other aryl iodide", "other aryl bromide", "primary amine", "thiol", "acyl halide" },
    recipe = "CuI, N,N-dimethylglycine or picolinic acid, Cs2CO3, dioxane or DMSO, 90-110 °C; also: I",
    yield = { 60, 90 },
    source = "Carey, Sundberg, Advanced Organic Chemistry Part B; from memory",
    example { "COc1ccc(Oc2cccc(C=O)c2)cc1", from = { "O=Cc1cccc(Br)c1", "COc1ccc(O)cc1" } },
    example { "c1ccc(cc1)Oc1ccccc1", from = { "Ic1ccccc1", "Oc1ccccc1" } },
    refuse { "COc1ccccc1" }, -- an alkyl aryl ether: alkylate the phenol
}

disconnection "ullmann-azole" {
    about = "Ullmann N-arylation of an azole; less hindered nitrogen",
    rxno = "RXNO:0000372",
    target = "[c;r6:1]-!@[nX3;r5;!$(n:c=[O,S]);!$(n:n:c=O):2]",
    cut = { 1, 2 },
    acceptor = { 1, "aryl-iodide" },
    donor = { 2, "azole" },
    conditions = "cu",
    also_attacks = { "other aryl iodide", "other aryl bromide", "primary amine", "acyl halide" },
    recipe = "CuI, trans-N,N'-dimethylcyclohexanediamine, K3PO4 or K2CO3, toluene or DMF, 110 °C; also: Br",
    yield = { 65, 95 },
    source = "Carey, Sundberg, Advanced Organic Chemistry Part B; from memory",
    example { "COc1ccc(-n2ccnc2)cc1", from = { "COc1ccc(I)cc1", "c1c[nH]cn1" } },
    example { "c1ccc(cc1)-n1ccnc1", from = { "Ic1ccccc1", "c1c[nH]cn1" } },
    refuse { "Cn1ccc2ccccc12" }, -- an alkyl group on nitrogen
}

disconnection "chan-lam" {
    about = "Chan-Lam coupling; ipso, at room temperature in air",
    rxno = "RXNO:0000374",
    target = "[c;$(c1ccccc1):1]-!@[#7;$([nX3;r5]),$([NX3;H1;+0](-c)-c):2]",
    cut = { 1, 2 },
    acceptor = { 1, "arylboronic-acid" },
    donor = { 2, "amine" },
    conditions = "cu",
    also_attacks = { "primary amine", "phenol", "thiol", "other boronic acid" },
    recipe = "Cu(OAc)2, pyridine or Et3N, CH2Cl2, air, rt",
    yield = { 50, 85 },
    cautions = { "pyridine", "dichloromethane" },
    source = "Kürti, Czakó, Strategic Applications of Named Reactions in Organic Synthesis; from memory",
    example { "CC(=O)c1ccc(-n2cccn2)cc1", from = { "CC(=O)c1ccc(B(O)O)cc1", "c1cc[nH]n1" } },
    example { "c1ccc(cc1)-n1ccnc1", from = { "OB(O)c1ccccc1", "c1c[nH]cn1" } },
    example { "c1ccc(cc1)Nc1ccccc1", from = { "OB(O)c1ccccc1", "Nc1ccccc1" } },
    refuse { "CN1CCCC1" }, -- no aryl group on nitrogen
}

disconnection "thioether-coupling" {
    about = "C-S coupling of an aryl halide and a thiol; ipso",
    target = "[c:1]-!@[SX2:2]-[#6;!$([#6]=[O,S,N]);!$([#6]#N):3]",
    cut = { 1, 2 },
    acceptor = { 1, "aryl-iodide" },
    donor = { 2, "thiol" },
    conditions = "cu",
    also_attacks = { "alkyl halide", "acyl halide", "enone", "epoxide", "other aryl iodide" },
    recipe = "CuI, ethylene glycol, K2CO3, iPrOH, 80 °C; Pd(OAc)2, Xantphos; also: Br",
    yield = { 75, 95 },
    cautions = { "thiol (stench)" },
    source = "Carey, Sundberg, Advanced Organic Chemistry Part B; from memory",
    example { "Nc1ccc(Sc2ccccc2)cc1", from = { "Nc1ccc(I)cc1", "Sc1ccccc1" } },
    example { "c1ccc(cc1)Sc1ccccc1", from = { "Ic1ccccc1", "Sc1ccccc1" } },
    refuse { "CC(=O)Sc1ccccc1" }, -- a thioester: acylate the thiophenol
}

interconversion "miyaura-borylation" {
    about = "Miyaura borylation; ipso",
    rxno = "RXNO:0000659",
    target = "[c:1]-[BX3:2]1-[OX2:3]-[C:4](-[CH3:5])(-[CH3:6])-[C:7](-[CH3:8])(-[CH3:9])-[OX2:10]-1",
    from = "[c:1]Br.[B:2]1(B2OC(C)(C)C(C)(C)O2)-[O:3]-[C:4](-[C:5])(-[C:6])-[C:7](-[C:8])(-[C:9])-[O:10]-1",
    conditions = "pd0",
    also_attacks = { "aryl bromide", "aryl iodide", "aryl triflate", "vinyl halide", "allylic ester",
        "acyl halide" },
    recipe = "Pd(dppf)Cl2, KOAc, dioxane or DMSO, 80-100 °C; also: I, OTf, Cl (XPhos)",
    yield = { 75, 95 },
    source = "Ishiyama, Murata, Miyaura, J. Org. Chem. 1995, 60, 7508; from memory",
    example { "CC1(C)OB(c2ccc(C#N)cc2)OC1(C)C", from = { "N#Cc1ccc(Br)cc1", "CC1(C)OB(B2OC(C)(C)C(C)(C)O2)OC1(C)C" } },
    example { "CC1(C)OB(c2ccccc2)OC1(C)C", from = { "Brc1ccccc1", "CC1(C)OB(B2OC(C)(C)C(C)(C)O2)OC1(C)C" } },
    refuse { "CCCB1OC(C)(C)C(C)(C)O1" }, -- an alkyl boronate
}

interconversion "alkenylboronic-acid" {
    about = "E-Alkenylboronic acid from a terminal alkyne; syn addition, boron at the end: E",
    rxno = "RXNO:0000292",
    target = "[BX3](-[OX2H1])(-[OX2H1])/[CX3;H1:1]=[CX3;H1:2]/[#6:3]",
    from = "[C:1]#[C:2]-[#6:3]",
    conditions = "borane",
    also_attacks = { "other alkyne", "other alkene", "aldehyde", "ketone" },
    recipe = "catecholborane, 70 °C, or pinacolborane, Cp2ZrHCl cat.; then H2O",
    yield = { 65, 90 },
    cautions = { "catecholborane" },
    source = "Carey, Sundberg, Advanced Organic Chemistry Part B; from memory",
    example { "OB(O)/C=C/CCCCl", from = { "C#CCCCCl" } },
    example { "CCCC/C=C/B(O)O", from = { "CCCCC#C" } },
    refuse { "OB(O)/C=C\\CC" }, -- the Z isomer is not formed
}

disconnection "cyanation-palladium" {
    about = "Palladium-catalysed cyanation; ipso",
    target = "[c:1]-[CX2:2]#[NX1:3]",
    cut = { 1, 2 },
    acceptor = { 1, "aryl-halide" },
    donor = { 2, "zinc-cyanide" },
    conditions = "pd0",
    also_attacks = { "aryl bromide", "aryl iodide", "aryl triflate", "vinyl halide", "allylic ester",
        "acyl halide" },
    recipe = "Pd(PPh3)4 or Pd2(dba)3/dppf, DMF, 80-120 °C; also: I, OTf; K4[Fe(CN)6]",
    yield = { 75, 95 },
    cautions = { "zinc cyanide" },
    source = "Carey, Sundberg, Advanced Organic Chemistry Part B; from memory",
    example { "N#Cc1ccc2[nH]ccc2c1", from = { "Brc1ccc2[nH]ccc2c1", "N#C[Zn]C#N" } },
    example { "N#Cc1ccccc1", from = { "Brc1ccccc1", "N#C[Zn]C#N" } },
    refuse { "N#CCc1ccccc1" }, -- nitrile not on the ring
}

disconnection "rosenmund-von-braun" {
    about = "Rosenmund-von Braun reaction; ipso",
    rxno = "RXNO:0000288",
    target = "[c:1]-[CX2:2]#[NX1:3]",
    cut = { 1, 2 },
    acceptor = { 1, "aryl-iodide" },
    donor = { 2, "copper-cyanide" },
    conditions = "cyanide",
    also_attacks = { "other aryl bromide", "other aryl iodide", "alkyl halide" },
    recipe = "CuCN, DMF or NMP, 150-200 °C; FeCl3 work-up; also: I",
    yield = { 65, 90 },
    cautions = { "copper(I) cyanide" },
    source = "Vogel's Textbook of Practical Organic Chemistry; from memory",
    example { "COc1ccc(C#N)c2ccccc12", from = { "COc1ccc(Br)c2ccccc12", "[Cu]C#N" } },
    example { "N#Cc1ccccc1", from = { "Brc1ccccc1", "[Cu]C#N" } },
    refuse { "N#CCc1ccccc1" }, -- nitrile not on the ring
}

disconnection "glaser" {
    about = "Glaser coupling; homocoupling",
    rxno = "RXNO:0000098",
    target = "[#6:1]-[CX2:2]#[CX2:3]-[CX2:4]#[CX2:5]-[#6:6]",
    from = "[#6:1]-[C:2]#[C:3].[C:4]#[C:5]-[#6:6]",
    when = function(m) return m.atom[1].symmetry == m.atom[6].symmetry end,
    conditions = "cu",
    also_attacks = { "thiol", "primary amine", "phenol" },
    recipe = "CuCl, TMEDA, O2, acetone, rt (Hay); Cu(OAc)2, pyridine (Eglinton)",
    yield = { 75, 95 },
    cautions = { "oxygen with organic solvent" },
    source = "Carey, Sundberg, Advanced Organic Chemistry Part B; from memory",
    example { "OCCC#CC#CCCO", from = { "C#CCCO", "C#CCCO" } },
    example { "C(#CC#Cc1ccccc1)c1ccccc1", from = { "C#Cc1ccccc1", "C#Cc1ccccc1" } },
    refuse { "CCC#CC#CCCO" }, -- both halves are the same alkyne
}

disconnection "cadiot-chodkiewicz" {
    about = "Cadiot-Chodkiewicz coupling; unsymmetrical diynes",
    rxno = "RXNO:0000100",
    target = "[#6:1]-[CX2:2]#[CX2:3]-[CX2:4]#[CX2:5]-[#6:6]",
    from = "[#6:1]-[C:2]#[C:3]Br.[C:4]#[C:5]-[#6:6]",
    when = function(m) return m.atom[1].symmetry ~= m.atom[6].symmetry end,
    conditions = "cu",
    also_attacks = { "aldehyde", "acyl halide", "other terminal alkyne" },
    recipe = "CuCl, NH2OH·HCl, EtNH2 or piperidine, MeOH/H2O, 0 °C",
    yield = { 60, 85 },
    cautions = { "bromoalkyne (unstable)" },
    source = "Kürti, Czakó, Strategic Applications of Named Reactions in Organic Synthesis; from memory",
    example { "OCCC#CC#Cc1ccc(OC)cc1", from = { "COc1ccc(C#CBr)cc1", "C#CCCO" } },
    example { "CCCCC#CC#Cc1ccccc1", from = { "BrC#Cc1ccccc1", "C#CCCCC" } },
    refuse { "CCC#CCCC#CCC" }, -- the alkynes are not joined directly
    refuse { "OCCC#CC#CCCO" }, -- two equal halves: Glaser coupling
}

disconnection "alkoxycarbonylation" {
    about = "Palladium-catalysed alkoxycarbonylation; ipso",
    target = "[c:1]-!@[CX3;+0:2](=[OX1;+0:3])-!@[OX2:4]-[CX4:5]",
    from = "[c:1]Br.[C-:2]#[O+:3].[O:4]-[C:5]",
    conditions = "pd0",
    also_attacks = { "free acid", "aryl bromide", "aryl iodide", "aryl triflate", "vinyl halide", "allylic ester",
        "primary amine", "secondary amine", "other free alcohol" },
    recipe = "Pd(OAc)2 or PdCl2(dppf), CO 1-10 bar, ROH, Et3N, 80-100 °C; also: I, OTf",
    yield = { 70, 95 },
    cautions = { "carbon monoxide" },
    source = "Carey, Sundberg, Advanced Organic Chemistry Part B; from memory",
    example { "CCOC(=O)c1cncc(C)c1", from = { "Cc1cncc(Br)c1", "[C-]#[O+]", "CCO" } },
    example { "CCOC(=O)c1ccccc1", from = { "Brc1ccccc1", "[C-]#[O+]", "CCO" } },
    refuse { "CCOC(=O)Cc1ccccc1" }, -- the ester is not on the ring
}

disconnection "aminocarbonylation" {
    about = "Palladium-catalysed aminocarbonylation; ipso",
    target = "[c:1]-!@[CX3;+0:2](=[OX1;+0:3])-!@[NX3;$(N-[CX4]);!$(N-[C,S]=[O,S,N]~[#6,#7,#8,#16;!c]);!$(N-[O,N]);!$(N-[CX4]-[OX2,NX3,Cl,Br]):4]",
    from = "[c:1]Br.[C-:2]#[O+:3].[N:4]",
    conditions = "pd0",
    also_attacks = { "free acid", "aryl bromide", "aryl iodide", "aryl triflate", "vinyl halide", "allylic ester",
        "other primary amine", "other secondary amine" },
    recipe = "Pd(OAc)2, Xantphos, CO 1-5 bar, Et3N or Na2CO3, toluene, 80-100 °C; also: I, OTf; Mo(CO)6",
    yield = { 70, 90 },
    cautions = { "carbon monoxide" },
    source = "Carey, Sundberg, Advanced Organic Chemistry Part B; from memory",
    example { "O=C(c1ccc(C(F)(F)F)cc1)N1CCOCC1", from = { "FC(F)(F)c1ccc(Br)cc1", "[C-]#[O+]", "C1COCCN1" } },
    example { "O=C(c1ccccc1)N1CCCCC1", from = { "Brc1ccccc1", "[C-]#[O+]", "C1CCCCN1" } },
    refuse { "O=C(Cc1ccccc1)N1CCOCC1" }, -- the amide is not on the ring
}

disconnection "alpha-arylation" {
    about = "α-Arylation of an ester or ketone; less substituted α carbon; double arylation is the rival " ..
        "with CH2",
    target = "[c:1]-!@[CX4;H0,H1,H2;!$(C([CX3]=O)[CX3]=O);!$(C-[F,Cl,Br,I,O]);!$(C-C#N);!$(C(c)(c)c):2]-[CX3;$(C(=O)([#6])[#6]),$(C(=O)[OX2][CX4]):3]=[OX1:4]",
    cut = { 1, 2 },
    acceptor = { 1, "aryl-halide" },
    donor = { 2, "enolate" },
    conditions = "base-hindered",
    also_attacks = { "primary amine", "secondary amine", "amidine", "aryl bromide", "aryl iodide", "aryl triflate", "vinyl halide", "allylic ester",
        "aldehyde", "free acid", "free alcohol", "acyl halide" },
    recipe = "Pd(OAc)2 or Pd(dba)2, P(tBu)3, NaOtBu or LiHMDS, toluene, rt to 80 °C; also: Cl",
    yield = { 65, 90 },
    source = "Culkin, Hartwig, Acc. Chem. Res. 2003, 36, 234; from memory",
    example { "COc1ccc2cc(C(C)C(=O)OC(C)(C)C)ccc2c1", from = { "COc1ccc2cc(Br)ccc2c1", "CCC(=O)OC(C)(C)C" } },
    example { "CC(C(=O)c1ccccc1)c1ccccc1", from = { "Brc1ccccc1", "CCC(=O)c1ccccc1" } },
    refuse { "O=C(O)Cc1ccccc1" }, -- a free acid quenches the enolate
}

disconnection "tsuji-trost" {
    about = "Tsuji-Trost allylation; linear, E; retention overall (double inversion)",
    rxno = "RXNO:0000311",
    target = "[CX4;H0,H1;$(C([CX3](=O)[O,#6])[CX3](=O)[O,#6]),$(C([CX3](=O)[O,#6])C#N):1]-!@[CX4;H2:2]-[CX3:3]=[CX3:4]",
    cut = { 2, 1 },
    acceptor = { 2, "allyl-acetate" },
    donor = { 1, "stabilised-carbanion" },
    conditions = "pd0-allyl",
    also_attacks = { "aryl iodide", "alkyl halide", "acyl halide", "other allylic ester", "primary amine" },
    recipe = "Pd(PPh3)4 or Pd2(dba)3/dppe, NaH or BSA, THF, rt; also: OCO2Me, OPO(OEt)2, Cl",
    yield = { 70, 95 },
    cautions = { "sodium hydride" },
    source = "Carey, Sundberg, Advanced Organic Chemistry Part B; from memory",
    example { "COC(=O)C(C/C=C/c1ccccc1)C(=O)OC", from = { "COC(=O)CC(=O)OC", "CC(=O)OC/C=C/c1ccccc1" } },
    example { "C=CCC(C(=O)OCC)C(=O)OCC", from = { "CCOC(=O)CC(=O)OCC", "CC(=O)OCC=C" } },
    refuse { "COC(=O)CCC=C" }, -- the nucleophile needs two activating groups
}

disconnection "nhk" {
    about = "Nozaki-Hiyama-Kishi coupling; aldehyde only; alkene geometry kept; little Felkin selectivity",
    rxno = "RXNO:0000191",
    target = "[CX3:1]=[CX3;!$(C=*=*):2]-!@[CX4;H1;!R:3]([OX2H1:4])-[#6;!$([#6]=[O,N,S]);!$([#6]#[N,C]):5]",
    cut = { 3, 2 },
    acceptor = { 3, "hydroxyalkyl" },
    donor = { 2, "alkenylchromium" },
    conditions = "grignard",
    also_attacks = { "other aldehyde", "aryl iodide", "allylic halide" },
    recipe = "CrCl2, NiCl2 cat., DMF or DMSO, rt; also: Br, OTf",
    yield = { 60, 85 },
    cautions = { "chromium(II) chloride" },
    source = "Kürti, Czakó, Strategic Applications of Named Reactions in Organic Synthesis; from memory",
    example { "CCOC(=O)CCCC(O)C(C)=C", from = { "C=C(C)I", "CCOC(=O)CCCC=O" } },
    example { "C=C(C)C(O)c1ccccc1", from = { "C=C(C)I", "O=Cc1ccccc1" } },
    refuse { "CC(C)=CC(C)(C)O" }, -- a tertiary alcohol: ketones do not react
}

disconnection "iron-cross-coupling" {
    about = "Iron-catalysed coupling of an aryl chloride with an alkyl Grignard reagent; ester survives: " ..
        "the coupling takes minutes",
    target = "[c;$(c1ccc(-C(=O)O[CX4])cc1),$(c1cc(-C(=O)O[CX4])ccc1),$([c;r6]:[n;X2]),$(c1ccncc1):1]-!@[C;X4;H2,H3;!$(C-[O,N,S,F,Cl,Br,I]);!$(C-C=O);!$(C-C#N):2]",
    cut = { 1, 2 },
    acceptor = { 1, "aryl-chloride" },
    donor = { 2, "organomagnesium" },
    when = function(m) return not m.molecule:has(PROTIC) end,
    conditions = "grignard",
    also_attacks = { "free alcohol", "free acid", "primary amine", "aldehyde", "ketone", "acyl halide", "nitro",
        "alkyl halide" },
    recipe = "Fe(acac)3 (5 mol%), THF/NMP, 0 °C, 10 min; also: tosylate, triflate",
    yield = { 70, 93 },
    cautions = { "N-methylpyrrolidone" },
    source = "Carey and Sundberg, Advanced Organic Chemistry, Part B; from memory",
    example { "CCCCCCc1ccc(cc1)C(=O)OC", from = { "COC(=O)c1ccc(Cl)cc1", "CCCCCC[Mg]Br" } },
    example { "CCCCc1ccccn1", from = { "Clc1ccccn1", "CCCC[Mg]Br" } },
    refuse { "CCCCc1ccc(OC)cc1" }, -- electron-rich chloride does not react
}

disconnection "sonogashira" {
    about = "Sonogashira coupling; ipso; iodide before bromide",
    rxno = "RXNO:0000579",
    target = "[c:1]-[CX2:2]#[CX2:3]-[#6,Si:4]",
    cut = { 1, 2 },
    acceptor = { 1, "aryl-iodide" },
    donor = { 2, "acetylide" },
    conditions = "pd0",
    also_attacks = { "aryl bromide", "aryl iodide", "aryl triflate", "vinyl halide", "allylic ester",
        "acyl halide", "other terminal alkyne" },
    recipe = "PdCl2(PPh3)2, CuI, Et3N, THF, rt (I) or 60-80 °C (Br); also: Br, OTf",
    yield = { 75, 95 },
    source = "Carey, Sundberg, Advanced Organic Chemistry Part B; from memory",
    example { "CC(C)(O)C#Cc1cccc(N)c1", from = { "Nc1cccc(I)c1", "C#CC(C)(C)O" } },
    example { "C(#Cc1ccccc1)c1ccccc1", from = { "Ic1ccccc1", "C#Cc1ccccc1" } },
    refuse { "CCCC#CCc1ccccc1" }, -- no bond between arene and alkyne
}

disconnection "heck-acrylate" {
    about = "Heck reaction with an electron-poor alkene; β carbon of the acceptor, E",
    rxno = "RXNO:0000024",
    target = "[c:1]/?[CX3;H1;!R:2]=[CX3;H1;!R:3]/?[#6;$([CX3](=O)([#6])[#6]),$([CX3](=O)[OX2][#6]),$([CX3](=O)[NX3]),$([CX2]#N):4]",
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
    example { "COC(=O)/C=C/c1ccccc1", from = { "Brc1ccccc1", "C=CC(=O)OC" } },
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
    also_attacks = { "free acid", "sulfonic acid", "phenol", "other primary aniline", "aryl bromide", "aryl iodide", "aryl triflate", "vinyl halide", "allylic ester",
        "aryl chloride", "acyl halide", "aldehyde", "other primary amine" },
    recipe = "Pd2(dba)3, BINAP or XPhos or RuPhos, NaOtBu or Cs2CO3, toluene, 80-110 °C; also: I, OTf, Cl",
    yield = { 70, 95 },
    cautions = { "sodium tert-butoxide" },
    source = "Carey, Sundberg, Advanced Organic Chemistry Part B; from memory",
    example { "COc1ccccc1N1CCN(C(=O)OC(C)(C)C)CC1", from = { "COc1ccccc1Br", "CC(C)(C)OC(=O)N1CCNCC1" } },
    example { "c1ccc(cc1)N1CCOCC1", from = { "Brc1ccccc1", "C1COCCN1" } },
    refuse { "CC(=O)Nc1ccccc1" }, -- an amide nitrogen: Goldberg or amide coupling
}
