-- Substitution on arenes: electrophilic, nucleophilic, through diazonium salts; side chains.
-- Yields are typical ranges and sources stand from memory unless a source says otherwise.

pack {
    name = "aromatic",
    version = "0.1.0",
    licence = "CC0-1.0",
    about = "Substitution on arenes: electrophilic, nucleophilic, through diazonium salts; side chains",
    needs = { "synthons", "preferences" },
}

-- Groups that direct ortho and para: donors, alkyl, halogen.
local GIVE = "[OX2,$([NX3;+0]),$([CX4;!$(C(F)(F)F)]),F,Cl,Br,I]"

-- Strong donors.
local STRONG = "[OX2,$([NX3;+0])]"

-- Acceptors, which direct meta.
local PULL = "[$([N+](=O)[O-]),$([CX3]=O),$(C#N),$(C(F)(F)F),$(S(=O)=O)]"

-- Acceptors that activate ortho and para positions for SNAr.
local ACTIVATE = "[$([N+](=O)[O-]),$([CX3]=O),$(C#N),$(S(=O)=O)]"

-- Ring atoms of azines that a nucleophile attacks.
local AZINE = "$(c1:n:c:c:c:c:1),$(c1:n:c:c:c:n:1),$(c1:n:c:n:c:c:1),$(c1:c:c:n:c:c:1),$(c1:n:c:c:n:c:1),$(c1:n:n:c:c:c:1)"

-- A benzene ring of its own: not fused with another aromatic ring, whose positions have rules of their own.
local BENZENE = "$(c1ccccc1);!$(c:[$(c(:a)(:a):a)]);!$(c:c:[$(c(:a)(:a):a)])"

interconversion "nitration-directed" {
    about = "Nitration, ortho/para to a donor; para over ortho with bulky donors",
    target = "[c;" .. BENZENE .. ";$(c:c-" .. GIVE .. "),$(c1:c:c:c(-" .. GIVE .. "):c:c:1);!$(c1:c:c(-" .. STRONG ..
        "):c:c:c:1):1]-[NX3+:2](=[OX1:3])-[O-:4]",
    from = "[cH:1].O[N+:2](=[O:3])[O-:4]",
    prefer = { "aromatic electrophilic, small", carbon = 1 },
    conditions = "nitration",
    also_attacks = { "phenol", "primary amine", "secondary amine", "aldehyde", "alkene", "sulfide",
        "other electron-rich arene" },
    recipe = "HNO3, H2SO4 or Ac2O or AcOH, 0-25 °C",
    yield = { 60, 90 },
    cautions = { "nitric acid", "sulfuric acid" },
    source = "Vogel's Textbook of Practical Organic Chemistry; from memory",
    example { "CC(=O)Nc1ccc([N+](=O)[O-])cc1F", from = { "CC(=O)Nc1ccccc1F", "O[N+](=O)[O-]" } },
    example { "COc1ccc([N+](=O)[O-])cc1", from = { "COc1ccccc1", "O[N+](=O)[O-]" } },
    refuse { "CC(=O)Nc1cccc([N+](=O)[O-])c1" }, -- meta to a donor
}

interconversion "thiophene-bromination" {
    about = "Bromination of thiophene at C2; α to sulfur",
    target = "[c;$([c;R1]1:s:[c;R1]:[c;R1]:[c;R1]:1):1]-Br",
    from = "[cH:1]",
    conditions = "br2",
    also_attacks = { "alkene", "phenol", "primary amine" },
    recipe = "NBS, DMF or AcOH, 0-25 °C; Br2, AcOH",
    yield = { 70, 95 },
    cautions = { "bromine" },
    source = "Joule, Mills, Heterocyclic Chemistry; from memory",
    example { "CC(=O)c1ccc(Br)s1", from = { "CC(=O)c1cccs1" } },
    example { "Brc1cccs1", from = { "c1ccsc1" } },
    refuse { "Brc1ccsc1" }, -- the β position needs another way
}

disconnection "fc-acylation-thiophene" {
    about = "Acylation of thiophene or furan at C2; α to the heteroatom",
    rxno = "RXNO:0000045",
    target = "[c;$([c;R1]1:[s,o]:[c;R1]:[c;R1]:[c;R1]:1);!$(c1:[s,o]:c(-[$([N+](=O)[O-]),$([CX3]=O)]):c:c1):1]-!@[CX3;!R:2](=[OX1:3])-[#6;!$([#6]=O):4]",
    cut = { 2, 1 },
    acceptor = { 2, "acyl" },
    donor = { 1, "arene" },
    conditions = "lewis-acid",
    also_attacks = { "free alcohol", "primary amine", "alkene" },
    recipe = "SnCl4 or BF3·OEt2, CH2Cl2, 0 °C; also: anhydride, H3PO4",
    yield = { 65, 90 },
    cautions = { "tin(IV) chloride" },
    source = "Joule, Mills, Heterocyclic Chemistry; from memory",
    example { "O=C(CCCCl)c1cccs1", from = { "c1ccsc1", "O=C(Cl)CCCCl" } },
    example { "CC(=O)c1ccco1", from = { "c1ccoc1", "CC(=O)Cl" } },
    refuse { "CC(=O)c1ccsc1" }, -- β position
}

disconnection "succinoylation" {
    about = "Succinoylation (Haworth, first step); para",
    rxno = "RXNO:0000045",
    target = "[c;$(c1:c:c:c(-" .. GIVE .. "):c:c:1),$(c1(-*):[cH]:[cH]:[cH]:[cH]:[cH]:1);!$(c1:c:c(-" ..
        PULL .. "):c:c:c:1);!$(c1:c(-" .. PULL .. "):c:c:c:c:1);!$(c1:c:c:c(-" ..
        PULL .. "):c:c:1);!$(c1:c:c:n:c:c:1);!$(c:n);!$(c:c:n):1]-!@[CX3;!R:2](=[OX1:3])-[CX4;H2:4]-[CX4;H2:5]-[CX3:6](=[OX1:7])-[OX2H1:8]",
    from = "[cH:1].[C:2]1(=[O:3])[C:4][C:5][C:6](=[O:7])[O:8]1",
    conditions = "lewis-acid",
    also_attacks = { "free alcohol", "primary amine", "alkene", "other electron-rich arene" },
    recipe = "AlCl3 (2.2 equiv.), CH2Cl2 or PhNO2, 0-25 °C; also: glutaric anhydride",
    yield = { 75, 95 },
    cautions = { "aluminium chloride" },
    source = "Vogel's Textbook of Practical Organic Chemistry; from memory",
    example { "O=C(O)CCC(=O)c1ccc(F)cc1", from = { "Fc1ccccc1", "O=C1CCC(=O)O1" } },
    example { "O=C(O)CCC(=O)c1ccccc1", from = { "c1ccccc1", "O=C1CCC(=O)O1" } },
    refuse { "O=C(O)CC(=O)c1ccccc1" }, -- a β-keto acid: malonic anhydride does not exist as a reagent
}

disconnection "fc-ring-closure" {
    about = "Cyclisation of an arylalkanoic acid (Haworth, last step); para to a donor where there is a " ..
        "choice; six ring over five",
    rxno = "RXNO:0000045",
    target = "[c;$(c1ccccc1),$(c1cccs1),$(c1ccsc1);!$(c1:c:c(-" .. PULL .. "):c:c:c:1);!$(c1:c(-" ..
        PULL .. "):c:c:c:c:1);!$(c1:c:c:c(-" .. PULL .. "):c:c:1):1]-;@[CX3;r5,r6;$(C1(=O)c:c[CX4,c][CX4]1),$(C1(=O)c:c[CX4,c][CX4][CX4]1),$(C1(=O)c:cO[CX4][CX4]1):2](=[OX1:3])-;@[CX4:4]",
    from = "([cH:1].O[C:2](=[O:3])[C:4])",
    conditions = "lewis-acid",
    also_attacks = { "free alcohol", "alkene", "primary amine", "acid-labile acetal" },
    recipe = "polyphosphoric acid, 80-100 °C; or SOCl2, then AlCl3; MsOH, P2O5",
    yield = { 70, 95 },
    cautions = { "polyphosphoric acid", "aluminium chloride" },
    source = "Vogel's Textbook of Practical Organic Chemistry; from memory",
    example { "COc1ccc2c(c1)CCCC2=O", from = { "COc1cccc(CCCC(=O)O)c1" } },
    example { "O=C1CCCc2ccccc12", from = { "O=C(O)CCCc1ccccc1" } },
    example { "O=C1CCc2ccccc12", from = { "O=C(O)CCc1ccccc1" } },
    refuse { "O=C1CCCCCc2ccccc12" }, -- an eight-membered ring does not close so
}

disconnection "gattermann" {
    about = "Gattermann formylation; para over ortho to OH or OR",
    rxno = "RXNO:0000139",
    target = "[c;$(c1:c:c:c(-[OX2]):c:c:1),$(c1:c(-[OX2]):c:c:c:c:1);!$(c1:c:c(-" ..
        PULL .. "):c:c:c:1);!$(c1:c(-" .. PULL .. "):c:c:c:c:1);!$(c1:c:c:c(-" ..
        PULL .. "):c:c:1);!$(c1:c:c:n:c:c:1);!$(c:n);!$(c:c:n):1]-[CX3;H1:2]=O",
    from = "[cH:1].[C:2]#N",
    conditions = "lewis-acid",
    also_attacks = { "primary amine", "alkene", "nitrile", "other electron-rich arene" },
    recipe = "Zn(CN)2, HCl, Et2O, 0 °C, then H2O (Adams)",
    yield = { 50, 85 },
    cautions = { "hydrogen cyanide", "zinc cyanide" },
    source = "March's Advanced Organic Chemistry; from memory",
    example { "O=Cc1ccc(O)cc1O", from = { "Oc1cccc(O)c1", "C#N" } },
    example { "COc1ccc(C=O)cc1", from = { "COc1ccccc1", "C#N" } },
    refuse { "O=Cc1cccc([N+](=O)[O-])c1" }, -- no O donor on the ring
}

disconnection "houben-hoesch" {
    about = "Houben-Hoesch ketone synthesis; para/ortho to two oxygen donors",
    target = "[c;$(c1:c(-[OX2]):c:c(-[OX2]):c:c:1):1]-[CX3;!R:2](=O)-[CX4:3]",
    from = "[cH:1].N#[C:2][C:3]",
    conditions = "acid-dry-strong",
    also_attacks = { "primary amine", "alkene", "other nitrile" },
    recipe = "HCl gas, ZnCl2, Et2O, 0 °C, then H2O, heat",
    yield = { 50, 85 },
    cautions = { "hydrogen chloride" },
    source = "Vogel's Textbook of Practical Organic Chemistry; from memory",
    example { "CC(=O)c1c(O)cc(O)cc1O", from = { "Oc1cc(O)cc(O)c1", "CC#N" } },
    example { "CCC(=O)c1ccc(O)cc1O", from = { "Oc1cccc(O)c1", "CCC#N" } },
    refuse { "CC(=O)c1ccc(O)cc1" }, -- simple phenols give the imidate at oxygen
}

disconnection "rieche-formylation" {
    about = "Rieche formylation; para over ortho to donors",
    target = "[c;$(c:c-[OX2,$([CX4;!$(C(F)(F)F)])]),$(c1:c:c:c(-[OX2,$([CX4;!$(C(F)(F)F)])]):c:c:1);!$(c1:c:c(-" ..
        PULL .. "):c:c:c:1);!$(c1:c(-" .. PULL .. "):c:c:c:c:1);!$(c1:c:c:c(-" ..
        PULL .. "):c:c:1);!$(c1:c:c:n:c:c:1);!$(c:n);!$(c:c:n):1]-[CX3;H1:2]=O",
    from = "[cH:1].Cl[C:2](Cl)OC",
    conditions = "lewis-acid",
    also_attacks = { "free alcohol", "primary amine", "alkene", "other electron-rich arene" },
    recipe = "Cl2CHOMe, TiCl4 or SnCl4, CH2Cl2, 0 °C",
    yield = { 65, 90 },
    cautions = { "dichloromethyl methyl ether", "titanium tetrachloride" },
    source = "Vogel's Textbook of Practical Organic Chemistry; from memory",
    example { "Cc1cc(C)c(C=O)c(C)c1", from = { "Cc1cc(C)cc(C)c1", "COC(Cl)Cl" } },
    example { "COc1ccc(C=O)cc1", from = { "COc1ccccc1", "COC(Cl)Cl" } },
    refuse { "O=Cc1cccc([N+](=O)[O-])c1" }, -- ring deactivated by nitro
    refuse { "O=Cc1ccc(Cl)cc1" }, -- a halogen is no donor for this
}

disconnection "phenol-ortho-formylation" {
    about = "ortho-Formylation of a phenol (Casnati-Skattebøl); ortho only",
    target = "[OX2H1:1]-[c;$(c1ccccc1):2]:[c;!$(c1:c(-" ..
        PULL .. "):c:c:c:c:1);!$(c:n);!$(c:c:n):3]-[CX3;H1:4]=[OX1:5]",
    from = "[O:1]-[c:2]:[cH:3].[C:4]=[O:5]",
    conditions = "base-aq-mild",
    also_attacks = { "primary amine", "secondary amine", "acyl halide" },
    recipe = "MgCl2, Et3N, paraformaldehyde, THF, reflux",
    yield = { 70, 95 },
    cautions = { "paraformaldehyde" },
    source = "Hofsløkken, Skattebøl, Acta Chem. Scand. 1999, 53, 258; from memory",
    example { "O=Cc1cc(Br)ccc1O", from = { "Oc1ccc(Br)cc1", "C=O" } },
    example { "O=Cc1ccccc1O", from = { "Oc1ccccc1", "C=O" } },
    refuse { "O=Cc1ccc(O)cc1" }, -- para to the phenol
}

disconnection "chloromethylation" {
    about = "Blanc chloromethylation; para over ortho; bis-alkylation and diarylmethanes are the rivals",
    target = "[c;$(c:c-" ..
        GIVE .. "),$(c1:c:c:c(-" .. GIVE .. "):c:c:1),$(c1(-*):[cH]:[cH]:[cH]:[cH]:[cH]:1);!$(c:c-" .. PULL .. ");!$(c:c:c-" .. PULL .. ");!$(c:c:c:c-" .. PULL .. "):1]-[CX4;H2:2]-Cl",
    from = "[cH:1].[C:2]=O",
    conditions = "acid-dry-strong",
    also_attacks = { "free alcohol", "primary amine", "alkene", "other electron-rich arene" },
    recipe = "paraformaldehyde, HCl, ZnCl2, AcOH; prefer CH2O/NaBH4/SOCl2 or side-chain chlorination",
    yield = { 50, 80 },
    step_cost = 60,
    cautions = { "bis(chloromethyl) ether (carcinogen formed in situ)", "formaldehyde", "hydrogen chloride" },
    source = "March's Advanced Organic Chemistry; from memory",
    example { "COc1ccc(CCl)cc1C", from = { "COc1ccccc1C", "C=O" } },
    example { "Cc1cc(C)c(CCl)c(C)c1", from = { "Cc1cc(C)cc(C)c1", "C=O" } },
    refuse { "O=[N+]([O-])c1ccc(CCl)cc1" }, -- ring deactivated by nitro
}

disconnection "azo-coupling" {
    about = "Azo coupling; para to OH or NR2, ortho if para is taken",
    rxno = "RXNO:0000096",
    target = "[c:1]-[NX2:2]=[NX2:3]-[c;$(c1:c:c:c(-[OX2H1,NX3]):c:c:1),$(c:c-[OX2H1]):4]",
    from = "[c:1][N:2].[Na+].[O-][N:3]=O.[cH:4]",
    conditions = "diazotisation",
    also_attacks = { "other primary amine", "other phenol" },
    recipe = "NaNO2, HCl, 0 °C; coupling at pH 5 (amines) or 9 (phenols)",
    yield = { 70, 95 },
    cautions = { "diazonium salt", "sodium nitrite" },
    source = "Vogel's Textbook of Practical Organic Chemistry; from memory",
    example { "CN(C)c1ccc(N=Nc2ccc(S(=O)(=O)O)cc2)cc1", from = { "Nc1ccc(S(=O)(=O)O)cc1", "[Na+].[O-]N=O", "CN(C)c1ccccc1" } },
    example { "Oc1ccc(N=Nc2ccccc2)cc1", from = { "Nc1ccccc1", "[Na+].[O-]N=O", "Oc1ccccc1" } },
    refuse { "c1ccc(N=Nc2ccccc2)cc1" }, -- neither ring carries OH or NR2
}

interconversion "arylhydrazine" {
    about = "Arylhydrazine from an aniline; ipso",
    target = "[c;$(c1ccccc1),$(c1:c:n:c:c:c:1):1]-[NX3;H1:2]-[NX3;H2:3]",
    from = "[c:1][N:2].[Na+].[O-][N:3]=O",
    conditions = "diazotisation",
    also_attacks = { "other primary amine", "phenol", "nitro" },
    recipe = "NaNO2, HCl, 0 °C, then SnCl2, HCl or Na2SO3",
    yield = { 65, 85 },
    cautions = { "arylhydrazine", "tin(II) chloride", "diazonium salt" },
    source = "Vogel's Textbook of Practical Organic Chemistry; from memory",
    example { "NNc1ccc(S(N)(=O)=O)cc1", from = { "Nc1ccc(S(N)(=O)=O)cc1", "[Na+].[O-]N=O" } },
    example { "NNc1ccccc1", from = { "Nc1ccccc1", "[Na+].[O-]N=O" } },
    refuse { "NNC(=O)c1ccccc1" }, -- a hydrazide
}

interconversion "snar-hydroxide" {
    about = "Phenol by SNAr of an activated aryl halide; ipso",
    target = "[c;$(c:c-[N+](=O)[O-]),$(c1:c:c:c(-[N+](=O)[O-]):c:c:1):1]-[OX2H1]",
    from = "[c:1]Cl",
    conditions = "base-aq-strong",
    also_attacks = { "ester", "nitrile", "alkyl halide", "acyl halide" },
    recipe = "aq. NaOH or Na2CO3, 60-100 °C; also: F",
    yield = { 75, 95 },
    source = "Vogel's Textbook of Practical Organic Chemistry; from memory",
    example { "O=[N+]([O-])c1ccc(O)c([N+](=O)[O-])c1", from = { "O=[N+]([O-])c1ccc(Cl)c([N+](=O)[O-])c1" } },
    example { "O=[N+]([O-])c1ccc(O)cc1", from = { "O=[N+]([O-])c1ccc(Cl)cc1" } },
    refuse { "Oc1cccc([N+](=O)[O-])c1" }, -- the nitro group is meta
}

disconnection "fries-ortho" {
    about = "ortho-Fries rearrangement; ortho at high temperature (chelate), para at low temperature",
    rxno = "RXNO:0000445",
    target = "[OX2H1:1]-[c;$(c1ccccc1):2]:[c;!$(c:c-" ..
        PULL .. ");!$(c:c:c-" .. PULL .. ");!$(c:c:c:c-" .. PULL .. "):3]-[CX3;!R:4](=[OX1:5])-[#6;!$([#6]=O);!$(C([CX3]=O)[CX3]=O):6]",
    from = "[O:1](-[c:2]:[cH:3])[C:4](=[O:5])[#6:6]",
    conditions = "lewis-acid",
    also_attacks = { "free alcohol", "alkyl ether", "primary amine", "alkene" },
    recipe = "AlCl3, neat, 120-160 °C; TiCl4; Sc(OTf)3",
    yield = { 45, 80 },
    cautions = { "aluminium chloride" },
    source = "Vogel's Textbook of Practical Organic Chemistry; from memory",
    example { "CCC(=O)c1cc(Cl)ccc1O", from = { "CCC(=O)Oc1ccc(Cl)cc1" } },
    example { "CC(=O)c1ccccc1O", from = { "CC(=O)Oc1ccccc1" } },
    refuse { "CC(=O)c1cccc(O)c1" }, -- meta to the phenol
    refuse { "CC(=O)c1cc([N+](=O)[O-])ccc1O" }, -- a nitro group stops it
}

disconnection "bischler-napieralski" {
    about = "Bischler-Napieralski reaction; para to a donor",
    rxno = "RXNO:0000053",
    target = "[c;$(c1:c:c:c(-[OX2]):c:c:1),$(c1:[nX3]:c:c:c:1):1]1:[c:2]-[CX4;H2:3]-[CX4:4]-[NX2:5]=[CX3:6]-1-[#6:7]",
    from = "[cH:1]:[c:2]-[C:3]-[C:4]-[N:5]-[C:6](=O)-[#6:7]",
    conditions = "acid-dry-strong",
    also_attacks = { "free alcohol", "free acid", "primary amide", "enolisable ketone" },
    recipe = "POCl3, MeCN or toluene, reflux; Tf2O, 2-chloropyridine",
    yield = { 60, 90 },
    cautions = { "phosphoryl chloride" },
    source = "Joule, Mills, Heterocyclic Chemistry; from memory",
    example { "COc1ccc(CC2=NCCc3cc(OC)c(OC)cc32)cc1OC", from = { "COc1ccc(CC(=O)NCCc2ccc(OC)c(OC)c2)cc1OC" } },
    example { "COc1cc2CCN=C(C)c2cc1OC", from = { "COc1ccc(CCNC(C)=O)cc1OC" } },
    refuse { "O=[N+]([O-])c1ccc2C(C)=NCCc2c1" }, -- ring deactivated by nitro
}

disconnection "pictet-spengler" {
    about = "Pictet-Spengler reaction; para to a donor; C2 of indole; cis or trans 1,3 by conditions",
    rxno = "RXNO:0000059",
    target = "[c;$(c1:c:c:c(-[OX2]):c:c:1),$(c1:[nX3]:c:c:c:1):1]1:[c:2]-[CX4;H2:3]-[CX4:4]-[NX3;H1:5]-[CX4;H1,H2:6]-1",
    from = "[cH:1]:[c:2]-[C:3]-[C:4]-[N:5].[C:6]=O",
    conditions = "acid-dry-strong",
    also_attacks = { "other aldehyde", "enol ether", "tert-butyl ester", "Boc carbamate", "other primary amine" },
    recipe = "TFA, CH2Cl2 or iPrOH reflux (HCl salt)",
    yield = { 65, 95 },
    cautions = { "trifluoroacetic acid" },
    source = "Joule, Mills, Heterocyclic Chemistry; from memory",
    example { "COC(=O)C1Cc2c([nH]c3ccccc23)C(c2ccc3c(c2)OCO3)N1", from = { "COC(=O)C(N)Cc1c[nH]c2ccccc12", "O=Cc1ccc2c(c1)OCO2" } },
    example { "C1CNCc2[nH]c3ccccc3c12", from = { "NCCc1c[nH]c2ccccc12", "C=O" } },
    refuse { "C1CNCc2ccccc12" }, -- benzene ring without a donor
}

interconversion "birch-ether" {
    about = "Birch reduction of an aryl ether; 2,5-dihydro: donors on the sp2 carbons",
    rxno = "RXNO:0000042",
    target = "[CX4;H2:1]1-[CX3;$(C-[OX2][CX4]):2]=[CX3;H1:3]-[CX4;H2:4]-[CX3:5]=[CX3;H1:6]-1",
    from = "[cH:1]1:[c:2]:[cH:3]:[cH:4]:[c:5]:[cH:6]:1",
    conditions = "birch",
    also_attacks = { "ketone", "aldehyde", "ester", "nitro", "aryl halide", "alkyl halide", "terminal alkyne",
        "benzyl ether" },
    recipe = "Li or Na, NH3 (l), tBuOH, THF, -78 to -33 °C",
    yield = { 75, 95 },
    cautions = { "lithium metal", "liquid ammonia" },
    source = "Clayden, Greeves, Warren, Organic Chemistry; from memory",
    example { "COC1=CCC(CCO)=CC1", from = { "COc1ccc(CCO)cc1" } },
    example { "COC1=CCC(C)=CC1", from = { "COc1ccc(C)cc1" } },
    refuse { "CC1=CC=CCC1" }, -- a conjugated diene
}

interconversion "birch-acid" {
    about = "Birch reduction of a benzoic acid; 1,4-dihydro: acceptors on the sp3 carbon",
    rxno = "RXNO:0000042",
    target = "[OX2H1:7]-[CX3:8](=[OX1:9])-[CX4;H1:1]1-[CX3;H1:2]=[CX3;H1:3]-[CX4;H2:4]-[CX3;H1:5]=[CX3;H1:6]-1",
    from = "[O:7]-[C:8](=[O:9])-[c:1]1:[cH:2]:[cH:3]:[cH:4]:[cH:5]:[cH:6]:1",
    conditions = "birch",
    also_attacks = { "ketone", "aldehyde", "nitro", "aryl halide", "alkyl halide", "terminal alkyne" },
    recipe = "Na or Li, NH3 (l), EtOH, -33 °C, then NH4Cl",
    yield = { 80, 95 },
    cautions = { "sodium metal", "liquid ammonia" },
    source = "Org. Synth. (Kuehne, Lambert); from memory",
    example { "O=C(O)C1C=CCC=C1", from = { "O=C(O)c1ccccc1" } },
    refuse { "O=C(O)C1=CCC=CC1" }, -- acceptor on an sp2 carbon
}

disconnection "directed-ortho-formylation" {
    about = "Directed ortho metalation and formylation; ortho to the strongest directing group",
    target = "[c;$(c-[CX3](=O)[NX3]([CX4])[CX4]),$(c-[OX2]C(=O)[NX3]([CX4])[CX4]),$(c-[OX2][CX4;H2][OX2][CX4]),$(c-[NX3;H1]C(=O)OC(C)(C)C):1]:[c:2]-[CX3;H1:3]=[OX1:4]",
    cut = { 3, 2 },
    acceptor = { 3, "formyl" },
    donor = { 2, "arene" },
    conditions = "organolithium",
    also_attacks = { "free alcohol", "free acid", "primary amine", "secondary amine", "aldehyde", "ketone",
        "ester", "nitrile", "amide", "acyl halide", "epoxide", "nitro", "aryl bromide", "aryl iodide",
        "terminal alkyne" },
    recipe = "sBuLi, TMEDA, THF, -78 °C, then DMF",
    yield = { 60, 85 },
    cautions = { "sec-butyllithium" },
    source = "Snieckus, Chem. Rev. 1990, 90, 879; from memory",
    example { "CCN(CC)C(=O)c1c(C=O)cccc1OC", from = { "CCN(CC)C(=O)c1ccccc1OC", "CN(C)C=O" } },
    example { "COCOc1ccccc1C=O", from = { "COCOc1ccccc1", "CN(C)C=O" } },
    refuse { "CCN(CC)C(=O)c1cccc(C=O)c1" }, -- meta to the directing group
}

disconnection "directed-ortho-carboxylation" {
    about = "Directed ortho metalation and carboxylation; ortho to the strongest directing group",
    target = "[c;$(c-[CX3](=O)[NX3]([CX4])[CX4]),$(c-[OX2]C(=O)[NX3]([CX4])[CX4]),$(c-[OX2][CX4;H2][OX2][CX4]),$(c-[NX3;H1]C(=O)OC(C)(C)C),$(c-[OX2][CH3]):1]:[c:2]-[CX3:3](=[OX1:4])-[OX2H1:5]",
    cut = { 3, 2 },
    acceptor = { 3, "carboxyl" },
    donor = { 2, "arene" },
    conditions = "organolithium",
    also_attacks = { "free alcohol", "free acid", "primary amine", "secondary amine", "aldehyde", "ketone",
        "ester", "nitrile", "amide", "acyl halide", "epoxide", "nitro", "aryl bromide", "aryl iodide",
        "terminal alkyne" },
    recipe = "BuLi or sBuLi, TMEDA, THF, -78 °C, then CO2",
    yield = { 55, 80 },
    cautions = { "butyllithium" },
    source = "Snieckus, Chem. Rev. 1990, 90, 879; from memory",
    example { "COCOc1ccc(F)cc1C(=O)O", from = { "COCOc1ccc(F)cc1", "O=C=O" } },
    example { "COc1ccccc1C(=O)O", from = { "COc1ccccc1", "O=C=O" } },
    refuse { "COCOc1cccc(C(=O)O)c1" }, -- meta to the directing group
}

disconnection "snar-chloroazine-hydrazine" {
    about = "Hydrazinoazine from a chloroazine",
    target = "[c;r6;" .. AZINE .. ":1]-[N;X3;H1:2][N;X3;H2:3]",
    cut = { 1, 2 },
    acceptor = { 1, "chloroazine" },
    donor = { 2, "amine" },
    conditions = "hydrazine",
    also_attacks = { "other chloroazine", "ester", "ketone", "aldehyde", "acyl halide", "imide", "alkyl halide" },
    recipe = "N2H4·H2O, EtOH or nBuOH, reflux",
    yield = { 75, 95 },
    cautions = { "hydrazine" },
    source = "Joule and Mills, Heterocyclic Chemistry; from memory",
    example { "NNc1nnc(cc1)-c1ccc(Cl)cc1", from = { "Clc1nnc(cc1)-c1ccc(Cl)cc1", "NN" } },
    example { "NNc1ccccn1", from = { "Clc1ccccn1", "NN" } },
    refuse { "NNc1ccccc1" }, -- no ring nitrogen: from the diazonium salt
}

disconnection "snar-chloroazine-ammonia" {
    about = "Aminoazine from a chloroazine and ammonia; position 4 before 2 in pyrimidines",
    target = "[c;r6;" .. AZINE .. ":1]-[N;X3;H2:2]",
    cut = { 1, 2 },
    acceptor = { 1, "chloroazine" },
    donor = { 2, "amine" },
    conditions = "amine-heat",
    also_attacks = { "other chloroazine", "ester", "acyl halide", "alkyl halide" },
    recipe = "conc. aq. NH3, iPrOH or dioxane, sealed tube, 80-120 °C; also: LiHMDS, PMB amine then CF3CO2H",
    yield = { 70, 92 },
    cautions = { "ammonia" },
    source = "Joule and Mills, Heterocyclic Chemistry; from memory",
    example { "Nc1ncnc2c1cc(Br)s2", from = { "Clc1ncnc2c1cc(Br)s2", "N" } },
    example { "Nc1ncccn1", from = { "Clc1ncccn1", "N" } },
    refuse { "Nc1cccnc1" }, -- the 3-position of pyridine is not activated
}

disconnection "snar-chloroazine-azole" {
    about = "N-Azolylazine from a chloroazine; less hindered azole nitrogen",
    target = "[c;r6;" .. AZINE .. ":1]-!@[n;r5;X3:2]",
    cut = { 1, 2 },
    acceptor = { 1, "chloroazine" },
    donor = { 2, "azole" },
    conditions = "alkylation",
    also_attacks = { "other chloroazine", "alkyl halide", "acyl halide" },
    recipe = "K2CO3 or Cs2CO3, DMF or MeCN, 60-100 °C; also: NaH",
    yield = { 70, 90 },
    cautions = { "N,N-dimethylformamide" },
    source = "Joule and Mills, Heterocyclic Chemistry; from memory",
    example { "FC(F)(F)c1ccnc(n1)-n1ccnc1", from = { "FC(F)(F)c1ccnc(Cl)n1", "c1c[nH]cn1" } },
    example { "c1ccnc(n1)-n1cccn1", from = { "Clc1ncccn1", "c1cc[nH]n1" } },
    refuse { "c1cncc(-n2ccnc2)c1" }, -- the 3-position of pyridine is not activated
}

disconnection "snar-azole-fluoroarene" {
    about = "N-Arylation of an azole by an activated aryl fluoride; less hindered azole nitrogen",
    target = "[c;$(c:c-[$([N+](=O)[O-]),$(C#N),$(S(=O)=O)]),$(c1:c:c:c(-" ..
        ACTIVATE .. "):c:c:1):1]-!@[n;r5;X3:2]",
    cut = { 1, 2 },
    acceptor = { 1, "fluoroarene" },
    donor = { 2, "azole" },
    conditions = "alkylation",
    also_attacks = { "other activated aryl fluoride", "alkyl halide", "acyl halide" },
    recipe = "K2CO3, DMSO or DMF, 90-120 °C",
    yield = { 75, 93 },
    cautions = { "N,N-dimethylformamide", "dimethyl sulfoxide" },
    source = "Joule and Mills, Heterocyclic Chemistry; from memory",
    example { "O=Cc1ccc(cc1Cl)-n1ccnc1", from = { "O=Cc1ccc(F)cc1Cl", "c1c[nH]cn1" } },
    example { "O=[N+]([O-])c1ccc(cc1)-n1ccnc1", from = { "O=[N+]([O-])c1ccc(F)cc1", "c1c[nH]cn1" } },
    refuse { "c1ccc(cc1)-n1ccnc1" }, -- no acceptor on the ring
}

disconnection "snar-carbon-nucleophile" {
    about = "SNAr by a stabilised carbanion; fluorine ortho or para to nitro",
    target = "[c;$(c:c-[N+](=O)[O-]),$(c1:c:c:c(-[N+](=O)[O-]):c:c:1):1]-!@[C;X4;H1;$(C([CX3](=O)O)[CX3](=O)O),$(C(C#N)[CX3](=O)O):2]",
    cut = { 1, 2 },
    acceptor = { 1, "activated-aryl" },
    donor = { 2, "stabilised-carbanion" },
    conditions = "base-hindered",
    also_attacks = { "other activated aryl fluoride", "alkyl halide", "acyl halide", "enone", "aldehyde" },
    recipe = "NaH or K2CO3, DMF or DMSO, 0-80 °C; also: aryl chloride",
    yield = { 75, 92 },
    cautions = { "sodium hydride", "N,N-dimethylformamide", "dimethyl sulfoxide" },
    source = "Carey and Sundberg, Advanced Organic Chemistry, Part B; from memory",
    example { "COC(=O)C(C(=O)OC)c1cc(Br)ccc1[N+](=O)[O-]", from = { "O=[N+]([O-])c1ccc(Br)cc1F", "COC(=O)CC(=O)OC" } },
    example { "CCOC(=O)C(C(=O)OCC)c1ccc(cc1)[N+](=O)[O-]", from = { "Fc1ccc(cc1)[N+](=O)[O-]", "CCOC(=O)CC(=O)OCC" } },
    refuse { "COC(=O)C(C(=O)OC)c1ccccc1" }, -- no nitro group on the ring
}

disconnection "snar-arylacetonitrile-chloropyridine" {
    about = "Diarylacetonitrile from a 2-chloropyridine; mono-substitution",
    target = "[c;r6;$(c1:n:c:c:c:c:1),$(c1:n:c:c:c:n:1):1]-!@[C;X4;H1:2]([C:3]#[N:4])[c:5]",
    cut = { 1, 2 },
    acceptor = { 1, "chloroazine" },
    donor = { 2, "stabilised-carbanion" },
    conditions = "base-hindered",
    also_attacks = { "other chloroazine", "alkyl halide", "ester", "ketone", "aldehyde" },
    recipe = "NaNH2 or KOtBu, toluene or THF, 0-80 °C; also: NaH/DMF, 2-fluoropyridine, 2-bromopyridine",
    yield = { 65, 88 },
    cautions = { "sodium amide", "potassium tert-butoxide" },
    source = "Kleemann and Engel, Pharmaceutical Substances; from memory",
    example { "N#CC(c1ccc(Cl)cc1)c1ccccn1", from = { "Clc1ccccn1", "N#CCc1ccc(Cl)cc1" } },
    example { "N#CC(c1ccccc1)c1ccccn1", from = { "Clc1ccccn1", "N#CCc1ccccc1" } },
    refuse { "N#CC(c1ccccc1)c1cccnc1" }, -- the 3-position of pyridine is not activated
}

disconnection "nitro-displacement-phthalonitrile" {
    about = "Displacement of an activated nitro group by a phenoxide; ipso; nitrite leaves",
    target = "[c;$(c1:c:c(-C#N):c(-C#N):c:c:1),$(c1:c:c2C(=O)[N,O]C(=O)c2:c:c:1):1]-!@[O;X2:2][c:3]",
    from = "[c:1][N+](=O)[O-].[O;H1:2][c:3]",
    conditions = "alkylation",
    also_attacks = { "activated aryl fluoride", "alkyl halide", "acyl halide", "thiol" },
    recipe = "K2CO3, DMF or DMSO, rt to 60 °C; also: thiolate, alkoxide; 4-nitrophthalimide",
    yield = { 75, 92 },
    cautions = { "N,N-dimethylformamide", "dimethyl sulfoxide" },
    source = "Larock, Comprehensive Organic Transformations; from memory",
    example { "N#Cc1ccc(Oc2ccc(Br)cc2)cc1C#N", from = { "N#Cc1ccc(cc1C#N)[N+](=O)[O-]", "Oc1ccc(Br)cc1" } },
    example { "N#Cc1ccc(Oc2ccccc2)cc1C#N", from = { "N#Cc1ccc(cc1C#N)[N+](=O)[O-]", "Oc1ccccc1" } },
    refuse { "N#Cc1ccc(Oc2ccccc2)cc1" }, -- one nitrile is too little
}

disconnection "nitropyridine-oxide-alkoxylation" {
    about = "Displacement of the nitro group of a 4-nitropyridine N-oxide; ipso; nitrite leaves",
    target = "[c;$(c1cc[n+]([O-])cc1):1]-!@[O;X2:2][C;X4:3]",
    from = "[c:1][N+](=O)[O-].[O;H1:2][C:3]",
    conditions = "alkoxide",
    also_attacks = { "alkyl halide", "acyl halide", "ester" },
    recipe = "NaOMe, MeOH, reflux; also: K2CO3/CF3CH2OH, AcCl for the chloride",
    yield = { 75, 92 },
    cautions = { "sodium methoxide" },
    source = "Kleemann and Engel, Pharmaceutical Substances; from memory",
    example { "COc1c(C)c[n+]([O-])c(C)c1C", from = { "Cc1c[n+]([O-])c(C)c(C)c1[N+](=O)[O-]", "CO" } },
    example { "CCOc1cc[n+]([O-])cc1", from = { "[O-][N+](=O)c1cc[n+]([O-])cc1", "CCO" } },
    refuse { "COc1cc[nH]c(=O)c1" }, -- no N-oxide to activate
}

interconversion "methylarene-to-aldehyde" {
    about = "Oxidation of an electron-rich methylarene to the aldehyde (benzylic oxidation); para methyl group",
    rxno = "RXNO:0000354",
    target = "[c;$(c1ccc([OX2])cc1):1][C;X3;H1:2]=[O;X1]",
    from = "[c:1][C;H3:2]",
    conditions = "ddq",
    also_attacks = { "phenol", "primary amine", "thioether", "other benzylic position", "alkene" },
    recipe = "ceric ammonium nitrate, AcOH or MeOH/H2O, 60-90 °C; also: DDQ/MeOH, MnO2/H2SO4, electrolysis",
    yield = { 55, 85 },
    cautions = { "cerium ammonium nitrate" },
    source = "March's Advanced Organic Chemistry; from memory",
    example { "COc1ccc(C=O)cc1Br", from = { "COc1ccc(C)cc1Br" } },
    example { "COc1ccc(C=O)cc1", from = { "COc1ccc(C)cc1" } },
    refuse { "O=Cc1cccc([N+](=O)[O-])c1" }, -- electron-poor ring: goes through the gem-diacetate
}

interconversion "methylazine-to-aldehyde" {
    about = "Selenium dioxide oxidation of a 2- or 4-methylazine to the aldehyde; methyl at position 2 or 4 " ..
        "of pyridine",
    target = "[c;r6;$(c1:n:c:c:c:c:1),$(c1:c:c:n:c:c:1):1][C;X3;H1:2]=[O;X1]",
    from = "[c:1][C;H3:2]",
    also_attacks = { "allylic position", "methylene ketone", "thioether", "primary amine" },
    recipe = "SeO2, dioxane/H2O, reflux",
    yield = { 60, 85 },
    cautions = { "selenium dioxide" },
    source = "Joule and Mills, Heterocyclic Chemistry; from memory",
    example { "O=Cc1ccc2cc(Br)ccc2n1", from = { "Cc1ccc2cc(Br)ccc2n1" } },
    example { "O=Cc1ccc2ccccc2n1", from = { "Cc1ccc2ccccc2n1" } },
    refuse { "O=Cc1cccnc1" }, -- the 3-methyl group is not activated
}

disconnection "boekelheide" {
    about = "Boekelheide rearrangement of a 2-methylpyridine N-oxide; 2-methyl before 4-methyl",
    target = "[n;X2;+0:7]:[c:1][C;X4;H2:2][O:3][C:4](=[O:5])[C;H3:6]",
    from = "[n+;H0:7]([O-]):[c:1][C;H3:2].[O:3]([C:4](=[O:5])[C:6])C(C)=O",
    conditions = "acylation",
    also_attacks = { "free alcohol", "primary amine", "secondary amine", "phenol", "thiol" },
    recipe = "Ac2O, 90-120 °C; also: (CF3CO)2O, rt, then water",
    yield = { 65, 88 },
    cautions = { "acetic anhydride" },
    source = "Joule and Mills, Heterocyclic Chemistry; from memory",
    example { "COc1c(C)cnc(COC(C)=O)c1C", from = { "COc1c(C)c[n+]([O-])c(C)c1C", "CC(=O)OC(C)=O" } },
    example { "CC(=O)OCc1ccccn1", from = { "Cc1cccc[n+]1[O-]", "CC(=O)OC(C)=O" } },
    refuse { "CC(=O)OCc1cccnc1" }, -- the 3-methyl group is not activated
}

interconversion "chloroazine-from-azinone" {
    about = "Chloroazine from a hydroxyazine (azinone) with phosphorus oxychloride; every oxo group α or γ " ..
        "to ring nitrogen is exchanged; precursor written as the hydroxy tautomer, it exists as the azinone",
    target = "[c;r6;" .. AZINE .. ":1]Cl",
    from = "[c:1][O;H1]",
    conditions = "socl2",
    also_attacks = { "free alcohol", "free acid", "primary amide", "primary amine", "phenol", "aldehyde",
        "other azinone" },
    recipe = "POCl3, N,N-diethylaniline or iPr2NEt, toluene, 80-110 °C; also: SOCl2/DMF (cat.), POBr3 for the bromide",
    yield = { 75, 95 },
    cautions = { "phosphorus oxychloride" },
    source = "Joule and Mills, Heterocyclic Chemistry; from memory",
    example { "COc1cc2ncnc(Cl)c2cc1OC", from = { "COc1cc2ncnc(O)c2cc1OC" } },
    example { "Clc1ncnc2ccccc12", from = { "Oc1ncnc2ccccc12" } },
    refuse { "Clc1cccnc1" }, -- the 3-position of pyridine is not activated
}

interconversion "chloroazine-from-nh-azinone" {
    about = "The same from the lactam tautomer, as azinones with the oxo group next to an N-H are sold and drawn",
    target = "[c;r6:1](Cl):[n;X2;+0;r6:2]",
    from = "[c:1](=O):[nH:2]",
    conditions = "socl2",
    also_attacks = { "free alcohol", "free acid", "primary amide", "primary amine", "phenol", "aldehyde",
        "other azinone" },
    recipe = "POCl3, N,N-diethylaniline or iPr2NEt, toluene, 80-110 °C",
    yield = { 75, 95 },
    cautions = { "phosphorus oxychloride" },
    source = "Joule and Mills, Heterocyclic Chemistry; from memory",
    example { "Clc1ncnc2ccccc12", from = { "O=c1[nH]cnc2ccccc12" } },
    example { "Clc1ccccn1", from = { "O=c1cccc[nH]1" } },
    refuse { "Clc1cccnc1" }, -- no N-H next to the oxo group
}

interconversion "chloropyridine-from-n-oxide" {
    about = "2-Chloropyridine from a pyridine N-oxide; α and γ mixtures; next to an acceptor at C3",
    target = "[n;X2;+0:2]:[c;r6;$(c:c-[$(C=O),$(C#N),$([N+](=O)[O-])]):1]Cl",
    from = "[n+;H0:2]([O-]):[cH:1]",
    conditions = "socl2",
    also_attacks = { "free alcohol", "free acid", "primary amide", "primary amine", "aldehyde" },
    recipe = "POCl3, Et3N, CH2Cl2 or toluene, 0-90 °C; also: oxalyl chloride/iPr2NEt",
    yield = { 55, 85 },
    cautions = { "phosphorus oxychloride", "triethylamine" },
    source = "Joule and Mills, Heterocyclic Chemistry; from memory",
    example { "COC(=O)c1cccnc1Cl", from = { "COC(=O)c1ccc[n+]([O-])c1" } },
    example { "N#Cc1cccnc1Cl", from = { "N#Cc1ccc[n+]([O-])c1" } },
    refuse { "Clc1ccccc1" }, -- no ring nitrogen beside the carbon
    refuse { "Clc1ccc(Br)cn1" }, -- no acceptor beside the carbon: mixtures
}

interconversion "naphthol-1-bromination" {
    about = "Bromination of a 2-naphthol or 2-alkoxynaphthalene at C1; C1 before C3 and C6",
    target = "[c;$(c1c([OX2])ccc2ccccc12):1]Br",
    from = "[cH:1]",
    conditions = "br2",
    also_attacks = { "alkene", "primary amine", "other electron-rich arene", "thioether" },
    recipe = "Br2 or NBS (1 equiv.), AcOH or MeCN, 0 °C to rt; also: NCS, NIS for chloride and iodide",
    yield = { 85, 97 },
    cautions = { "bromine", "N-bromosuccinimide" },
    source = "Vogel's Textbook of Practical Organic Chemistry; from memory",
    example { "CCOC(=O)COc1ccc2ccccc2c1Br", from = { "CCOC(=O)COc1ccc2ccccc2c1" } },
    example { "COc1ccc2ccccc2c1Br", from = { "COc1ccc2ccccc2c1" } },
    refuse { "COc1cc(Br)c2ccccc2c1" }, -- C4, meta to oxygen, is not attacked
}

interconversion "naphthol-6-bromination" {
    about = "6-Bromo-2-naphthol by dibromination and reduction; first C1, then C6; the labile C1 bromine is " ..
        "reduced again",
    target = "[c;$(c1ccc2cc([OX2H1])ccc2c1):1]Br",
    from = "[cH:1]",
    conditions = "br2",
    also_attacks = { "alkene", "primary amine", "other electron-rich arene", "thioether" },
    recipe = "Br2 (2 equiv.), AcOH, then Sn or Na2SO3, reflux",
    yield = { 80, 95 },
    cautions = { "bromine" },
    source = "Vogel's Textbook of Practical Organic Chemistry; from memory",
    example { "Oc1ccc2cc(Br)ccc2c1", from = { "Oc1ccc2ccccc2c1" } },
    refuse { "COc1ccc2c(Br)cccc2c1" }, -- C5 is not attacked
}

disconnection "methoxynaphthalene-6-acylation" {
    about = "Friedel-Crafts acylation of 2-methoxynaphthalene at C6; C6 in nitrobenzene (thermodynamic)",
    rxno = "RXNO:0000045",
    target = "[c;$(c1ccc2cc([OX2][CX4])ccc2c1):1]-[C;X3:2](=[O:3])[C;X4:4]",
    cut = { 2, 1 },
    acceptor = { 2, "acyl" },
    donor = { 1, "arene" },
    conditions = "lewis-acid",
    also_attacks = { "other electron-rich arene", "free alcohol", "primary amine", "alkene", "phenol" },
    recipe = "AlCl3, nitrobenzene, 0 °C to rt",
    yield = { 60, 80 },
    cautions = { "nitrobenzene", "aluminium chloride" },
    source = "Kleemann and Engel, Pharmaceutical Substances; from memory",
    example { "COc1ccc2cc(ccc2c1)C(C)=O", from = { "COc1ccc2ccccc2c1", "CC(=O)Cl" } },
    example { "CCC(=O)c1ccc2cc(OC)ccc2c1", from = { "COc1ccc2ccccc2c1", "CCC(=O)Cl" } },
    refuse { "COc1ccc2ccccc2c1C(C)=O" }, -- C1: formed in CH2Cl2 or CS2
}

disconnection "methoxynaphthalene-1-acylation" {
    about = "Friedel-Crafts acylation of 2-methoxynaphthalene at C1; C1 (kinetic)",
    rxno = "RXNO:0000045",
    target = "[c;$(c1c([OX2][CX4])ccc2ccccc12):1]-[C;X3:2](=[O:3])[#6:4]",
    cut = { 2, 1 },
    acceptor = { 2, "acyl" },
    donor = { 1, "arene" },
    conditions = "lewis-acid",
    also_attacks = { "other electron-rich arene", "free alcohol", "primary amine", "alkene", "phenol" },
    recipe = "AlCl3, CH2Cl2 or CS2, 0 °C",
    yield = { 70, 90 },
    cautions = { "carbon disulfide", "aluminium chloride" },
    source = "March's Advanced Organic Chemistry; from memory",
    example { "COc1ccc2ccccc2c1C(=O)c1ccc(Cl)cc1", from = { "COc1ccc2ccccc2c1", "O=C(Cl)c1ccc(Cl)cc1" } },
    example { "COc1ccc2ccccc2c1C(C)=O", from = { "COc1ccc2ccccc2c1", "CC(=O)Cl" } },
    refuse { "COc1ccc2cc(ccc2c1)C(C)=O" }, -- C6: formed in nitrobenzene
}

disconnection "naphthalene-1-nitration" {
    about = "Nitration of naphthalene at C1; α position; para to an alkyl group at C1",
    target = "[c;$(c1cccc2ccccc12);!$(c1c([OX2,NX3])cccc1);!$(c1ccc([OX2,NX3])cc1):1]-[N+:2](=[O:3])[O-:4]",
    from = "[cH:1].O[N+:2](=[O:3])[O-:4]",
    conditions = "nitration",
    also_attacks = { "alkene", "free alcohol", "primary amine", "phenol", "aldehyde", "thioether" },
    recipe = "HNO3, H2SO4, 50-60 °C",
    yield = { 65, 90 },
    cautions = { "sulfuric acid", "nitric acid" },
    source = "Vogel's Textbook of Practical Organic Chemistry; from memory",
    example { "Cc1ccc([N+](=O)[O-])c2ccccc12", from = { "Cc1cccc2ccccc12", "O[N+](=O)[O-]" } },
    example { "O=[N+]([O-])c1cccc2ccccc12", from = { "c1ccc2ccccc2c1", "O[N+](=O)[O-]" } },
    refuse { "O=[N+]([O-])c1ccc2ccccc2c1" }, -- the β position is not attacked
}

interconversion "naphthalene-1-bromination" {
    about = "Bromination of naphthalene at C1; α position; para to an alkyl group at C1",
    target = "[c;$(c1cccc2ccccc12);!$(c1c([OX2,NX3])cccc1);!$(c1ccc([OX2,NX3])cc1):1]Br",
    from = "[cH:1]",
    conditions = "br2",
    also_attacks = { "alkene", "phenol", "primary amine", "other electron-rich arene" },
    recipe = "Br2, CH2Cl2 or CCl4, rt to reflux; also: NBS/MeCN",
    yield = { 70, 90 },
    cautions = { "carbon tetrachloride", "bromine" },
    source = "Vogel's Textbook of Practical Organic Chemistry; from memory",
    example { "Cc1ccc(Br)c2ccccc12", from = { "Cc1cccc2ccccc12" } },
    example { "Brc1cccc2ccccc12", from = { "c1ccc2ccccc2c1" } },
    refuse { "Brc1ccc2ccccc2c1" }, -- the β position is not attacked
}

interconversion "indole-3-iodination" {
    about = "Iodination of an indole at C3; C3",
    target = "[c;$(c1[cH][nX3]c2ccccc12),$(c1c(-[#6])[nX3]c2ccccc12):1]I",
    from = "[cH:1]",
    conditions = "br2",
    also_attacks = { "alkene", "phenol", "thiol", "other NH azole" },
    recipe = "I2, KOH, DMF, rt; also: NIS, acetone",
    yield = { 80, 95 },
    cautions = { "iodine", "potassium hydroxide", "N,N-dimethylformamide" },
    source = "Joule and Mills, Heterocyclic Chemistry; from memory",
    example { "Ic1c[nH]c2ccc(cc12)C#N", from = { "N#Cc1ccc2[nH]ccc2c1" } },
    example { "Ic1c[nH]c2ccccc12", from = { "c1ccc2[nH]ccc2c1" } },
    refuse { "Ic1cc2ccccc2[nH]1" }, -- C2 is not attacked
}

interconversion "indole-3-bromination" {
    about = "Bromination of an indole at C3; C3",
    target = "[c;$(c1[cH][nX3]c2ccccc12),$(c1c(-[#6])[nX3]c2ccccc12):1]Br",
    from = "[cH:1]",
    conditions = "br2",
    also_attacks = { "alkene", "phenol", "primary amine", "thioether" },
    recipe = "NBS, DMF or THF, 0 °C; also: Br2/DMF, pyridinium tribromide",
    yield = { 75, 93 },
    cautions = { "N,N-dimethylformamide", "N-bromosuccinimide" },
    source = "Joule and Mills, Heterocyclic Chemistry; from memory",
    example { "COC(=O)c1ccc2c(Br)c[nH]c2c1", from = { "COC(=O)c1ccc2cc[nH]c2c1" } },
    example { "Brc1c[nH]c2ccccc12", from = { "c1ccc2[nH]ccc2c1" } },
    refuse { "Brc1cc2ccccc2[nH]1" }, -- C2 is not attacked
}

disconnection "indole-glyoxylation" {
    about = "Acylation of an indole by oxalyl chloride; C3; amine then gives the glyoxamide, LiAlH4 the " ..
        "tryptamine",
    target = "[c;$(c1c[nX3]c2ccccc12):1]-[C;X3:2](=[O:3])[C;X3:4](=[O:5])Cl",
    from = "[cH:1].Cl[C:2](=[O:3])[C:4](=[O:5])Cl",
    conditions = "acylation",
    also_attacks = { "primary amine", "secondary amine", "free alcohol", "phenol", "thiol" },
    recipe = "(COCl)2, Et2O, 0 °C",
    yield = { 80, 97 },
    cautions = { "oxalyl chloride" },
    source = "Joule and Mills, Heterocyclic Chemistry; from memory",
    example { "O=C(Cl)C(=O)c1c[nH]c2ccc(OCc3ccccc3)cc12", from = { "c1ccc(COc2ccc3[nH]ccc3c2)cc1", "O=C(Cl)C(=O)Cl" } },
    example { "O=C(Cl)C(=O)c1c[nH]c2ccccc12", from = { "c1ccc2[nH]ccc2c1", "O=C(Cl)C(=O)Cl" } },
    refuse { "O=C(Cl)C(=O)c1ccccc1" }, -- benzene needs a Lewis acid
}

interconversion "pyrazole-4-bromination" {
    about = "Bromination of a pyrazole at C4; C4",
    target = "[c;$(c1cn[nX3]c1):1]Br",
    from = "[cH:1]",
    conditions = "br2",
    also_attacks = { "alkene", "phenol", "primary amine", "thioether", "other electron-rich arene" },
    recipe = "NBS, DMF or MeCN, rt; also: Br2/AcOH; NIS or I2/CAN for the iodide",
    yield = { 80, 95 },
    cautions = { "N,N-dimethylformamide", "N-bromosuccinimide" },
    source = "Joule and Mills, Heterocyclic Chemistry; from memory",
    example { "CCOC(=O)c1nn(C)cc1Br", from = { "CCOC(=O)c1ccn(C)n1" } },
    example { "Brc1cn[nH]c1", from = { "c1cn[nH]c1" } },
    refuse { "Brc1ccn(C)n1" }, -- C3 is not attacked
}

disconnection "imidazole-nitration" {
    about = "Nitration of an imidazole at C4(5); C4 or C5, the same in the NH tautomers",
    target = "[c;$(c1c[nX2]c[nX3]1),$(c1c[nX3]c[nX2]1):1]-[N+:2](=[O:3])[O-:4]",
    from = "[cH:1].O[N+:2](=[O:3])[O-:4]",
    conditions = "nitration",
    also_attacks = { "alkene", "free alcohol", "primary amine", "phenol", "aldehyde", "thioether" },
    recipe = "HNO3, H2SO4, 100-140 °C",
    yield = { 60, 80 },
    cautions = { "sulfuric acid", "nitric acid" },
    source = "Joule and Mills, Heterocyclic Chemistry; from memory",
    example { "Cc1ncc([N+](=O)[O-])[nH]1", from = { "Cc1ncc[nH]1", "O[N+](=O)[O-]" } },
    example { "O=[N+]([O-])c1c[nH]cn1", from = { "c1c[nH]cn1", "O[N+](=O)[O-]" } },
    refuse { "O=[N+]([O-])c1ncc[nH]1" }, -- C2 is not attacked
}

interconversion "aminopyridine-5-bromination" {
    about = "Bromination of a 2-aminopyridine or 2-aminopyrimidine at C5; para to the amino group",
    target = "[c;$(c1ccc([NX3;+0])nc1),$(c1cnc([NX3;+0])nc1):1]Br",
    from = "[cH:1]",
    conditions = "br2",
    also_attacks = { "alkene", "phenol", "other electron-rich arene", "thioether" },
    recipe = "NBS, MeCN or DMF, 0 °C to rt; also: Br2/AcOH; NIS or I2/H5IO6 for the iodide",
    yield = { 80, 95 },
    cautions = { "N,N-dimethylformamide", "N-bromosuccinimide" },
    source = "Joule and Mills, Heterocyclic Chemistry; from memory",
    example { "Cc1cc(N)ncc1Br", from = { "Cc1ccnc(N)c1" } },
    example { "Nc1ccc(Br)cn1", from = { "Nc1ccccn1" } },
    example { "Nc1ncc(Br)cn1", from = { "Nc1ncccn1" } },
    refuse { "Nc1cccc(Br)n1" }, -- C6 is not attacked
}

interconversion "aminopyridine-3-bromination-blocked" {
    about = "Bromination of a 2-aminopyridine at C3 when C5 is blocked; ortho to the amino group",
    target = "[c;$(c1c([NX3;H2;+0])ncc(-[#6,Cl,Br,F])c1):1]Br",
    from = "[cH:1]",
    conditions = "br2",
    also_attacks = { "alkene", "phenol", "other electron-rich arene", "thioether" },
    recipe = "NBS or Br2, AcOH or MeCN, rt; also: NIS or I2 for the iodide",
    yield = { 70, 92 },
    cautions = { "bromine", "N-bromosuccinimide" },
    source = "Joule and Mills, Heterocyclic Chemistry; from memory",
    example { "Cc1cnc(N)c(Br)c1", from = { "Cc1ccc(N)nc1" } },
    example { "Nc1ncc(Cl)cc1Br", from = { "Nc1ccc(Cl)cn1" } },
    refuse { "Nc1ncccc1Br" }, -- C5 free: it reacts first
}

disconnection "pyridine-oxide-4-nitration" {
    about = "Nitration of a pyridine N-oxide at C4; C4",
    target = "[c;$(c1cc[n+]([O-])cc1):1]-[N+:2](=[O:3])[O-:4]",
    from = "[cH:1].O[N+:2](=[O:3])[O-:4]",
    conditions = "nitration",
    also_attacks = { "alkene", "free alcohol", "primary amine", "phenol", "aldehyde", "thioether" },
    recipe = "fuming HNO3, H2SO4, 90-100 °C",
    yield = { 65, 90 },
    cautions = { "sulfuric acid", "nitric acid" },
    source = "Joule and Mills, Heterocyclic Chemistry; from memory",
    example { "Cc1c[n+]([O-])c(C)c(C)c1[N+](=O)[O-]", from = { "Cc1c[n+]([O-])c(C)c(C)c1", "O[N+](=O)[O-]" } },
    example { "O=[N+]([O-])c1cc[n+]([O-])cc1", from = { "c1cc[n+]([O-])cc1", "O[N+](=O)[O-]" } },
    refuse { "O=[N+]([O-])c1ccncc1" }, -- no N-oxide: pyridine itself does not react
}

disconnection "isoquinoline-5-nitration" {
    about = "Nitration of an isoquinoline at C5; C5 before C8 (about 9:1)",
    target = "[c;$(c1cccc2cnccc12):1]-[N+:2](=[O:3])[O-:4]",
    from = "[cH:1].O[N+:2](=[O:3])[O-:4]",
    conditions = "nitration",
    also_attacks = { "alkene", "free alcohol", "primary amine", "phenol", "aldehyde" },
    recipe = "KNO3 or HNO3, H2SO4, 0 °C",
    yield = { 70, 90 },
    cautions = { "sulfuric acid", "nitric acid" },
    source = "Joule and Mills, Heterocyclic Chemistry; from memory",
    example { "O=[N+]([O-])c1cccc2cnccc12", from = { "c1ccc2cnccc2c1", "O[N+](=O)[O-]" } },
    refuse { "O=[N+]([O-])c1ccc2ccncc2c1" }, -- C7 is not attacked
}

disconnection "quinoline-8-nitration" {
    about = "Nitration of quinoline at C8; about 1:1 with C5, separated by crystallisation",
    target = "[c;$(c1cccc2cccnc12):1]-[N+:2](=[O:3])[O-:4]",
    from = "[cH:1].O[N+:2](=[O:3])[O-:4]",
    conditions = "nitration",
    also_attacks = { "alkene", "free alcohol", "primary amine", "phenol", "aldehyde" },
    recipe = "HNO3, H2SO4, 0 °C",
    yield = { 35, 45 },
    cautions = { "sulfuric acid", "nitric acid" },
    source = "Joule and Mills, Heterocyclic Chemistry; from memory",
    example { "O=[N+]([O-])c1cccc2cccnc12", from = { "c1ccc2ncccc2c1", "O[N+](=O)[O-]" } },
    refuse { "O=[N+]([O-])c1ccc2ncccc2c1" }, -- C6 is not attacked
}

disconnection "thiophene-chlorosulfonation" {
    about = "Chlorosulfonation of a thiophene at C2; α position",
    target = "[c;$(c1cccs1):1]-[S;X4:2](=[O:3])(=[O:4])Cl",
    from = "[cH:1].[S:2](=[O:3])(=[O:4])(O)Cl",
    conditions = "so3",
    also_attacks = { "free alcohol", "primary amine", "phenol", "alkene", "other electron-rich arene" },
    recipe = "HSO3Cl, PCl5, 0-50 °C",
    yield = { 60, 85 },
    cautions = { "chlorosulfonic acid" },
    source = "Joule and Mills, Heterocyclic Chemistry; from memory",
    example { "Clc1ccc(s1)S(=O)(=O)Cl", from = { "Clc1cccs1", "OS(=O)(=O)Cl" } },
    example { "O=S(=O)(Cl)c1cccs1", from = { "c1ccsc1", "OS(=O)(=O)Cl" } },
    refuse { "O=S(=O)(Cl)c1ccsc1" }, -- C3 is not attacked
}

disconnection "sulfonyl-chloride-from-aniline" {
    about = "Arylsulfonyl chloride from a diazonium salt and sulfur dioxide (Meerwein); ipso: any position " ..
        "for which there is an aniline",
    target = "[c;$(c1ccccc1),$(c1:c:n:c:c:c:1):1]-[S;X4:2](=[O:3])(=[O:4])Cl",
    from = "[c:1][N;H2].[S:2](=[O:3])=[O:4]",
    conditions = "diazotisation",
    also_attacks = { "other primary amine", "phenol", "alkene" },
    recipe = "NaNO2, HCl, -5 °C, then SO2, CuCl or CuCl2, AcOH; also: SOCl2/H2O as source of SO2",
    yield = { 60, 85 },
    cautions = { "sulfur dioxide", "hydrochloric acid", "sodium nitrite" },
    source = "Vogel's Textbook of Practical Organic Chemistry; from memory",
    example { "COC(=O)c1ccc(cc1Cl)S(=O)(=O)Cl", from = { "COC(=O)c1ccc(N)cc1Cl", "O=S=O" } },
    example { "O=S(=O)(Cl)c1cccnc1", from = { "Nc1cccnc1", "O=S=O" } },
    refuse { "CCS(=O)(=O)Cl" }, -- aliphatic
}

interconversion "nitration-meta" {
    about = "Nitration, meta to an acceptor; meta to an acceptor",
    target = "[c;" .. BENZENE .. ";$(c1:c:c(-" .. PULL .. "):c:c:c:1);!$(c:c-" .. GIVE .. ");!$(c1:c:c:c(-" .. GIVE ..
        "):c:c:1):1]-[NX3+:2](=[OX1:3])-[O-:4]",
    from = "[cH:1].O[N+:2](=[O:3])[O-:4]",
    prefer = { "aromatic electrophilic, small", carbon = 1 },
    conditions = "nitration",
    also_attacks = { "phenol", "primary amine", "secondary amine", "aldehyde", "alkene", "sulfide",
        "other electron-rich arene" },
    recipe = "HNO3, H2SO4, 0-60 °C",
    yield = { 70, 90 },
    cautions = { "nitric acid", "sulfuric acid" },
    source = "Vogel's Textbook of Practical Organic Chemistry; from memory",
    example { "COC(=O)c1cccc([N+](=O)[O-])c1", from = { "COC(=O)c1ccccc1", "O[N+](=O)[O-]" } },
    example { "O=[N+]([O-])c1cccc([N+](=O)[O-])c1", from = { "O=[N+]([O-])c1ccccc1", "O[N+](=O)[O-]" } },
    refuse { "COC(=O)c1ccc([N+](=O)[O-])cc1" }, -- para to an acceptor
}

interconversion "bromination-directed" {
    about = "Bromination of an arene, ortho/para to a donor; para over ortho",
    target = "[c;" .. BENZENE .. ";$(c:c-" .. GIVE .. "),$(c1:c:c:c(-" .. GIVE .. "):c:c:1):1]-Br",
    from = "[cH:1]",
    prefer = { "aromatic electrophilic", carbon = 1 },
    conditions = "br2",
    also_attacks = { "alkene", "phenol", "primary amine", "enolisable ketone", "other electron-rich arene" },
    recipe = "Br2, AcOH or FeBr3; NBS, MeCN (activated arenes), 0-25 °C",
    yield = { 70, 95 },
    cautions = { "bromine" },
    source = "Vogel's Textbook of Practical Organic Chemistry; from memory",
    example { "COc1ccc(Br)cc1C=O", from = { "COc1ccccc1C=O" } },
    example { "CC(=O)Nc1ccc(Br)cc1", from = { "CC(=O)Nc1ccccc1" } },
    refuse { "COc1cccc(Br)c1" }, -- meta to a donor
}

interconversion "bromination-meta" {
    about = "Bromination of a deactivated arene; meta to an acceptor",
    target = "[c;" .. BENZENE .. ";$(c1:c:c(-" .. PULL .. "):c:c:c:1);!$(c:c-" .. GIVE .. ");!$(c1:c:c:c(-" .. GIVE ..
        "):c:c:1):1]-Br",
    from = "[cH:1]",
    prefer = { "aromatic electrophilic", carbon = 1 },
    conditions = "br2",
    also_attacks = { "alkene", "phenol", "primary amine", "other electron-rich arene" },
    recipe = "Br2, Fe, 120-140 °C; or NBS, H2SO4; DBDMH, H2SO4",
    yield = { 60, 85 },
    cautions = { "bromine" },
    source = "Vogel's Textbook of Practical Organic Chemistry; from memory",
    example { "O=[N+]([O-])c1cccc(Br)c1", from = { "O=[N+]([O-])c1ccccc1" } },
    example { "OC(=O)c1cccc(Br)c1", from = { "OC(=O)c1ccccc1" } },
    refuse { "O=[N+]([O-])c1ccc(Br)cc1" }, -- para to an acceptor
}

interconversion "chlorination-directed" {
    about = "Chlorination of an arene, ortho/para to a donor; para, then ortho",
    target = "[c;" .. BENZENE .. ";$(c:c-" .. STRONG .. "),$(c1:c:c:c(-" .. STRONG .. "):c:c:1):1]-Cl",
    from = "[cH:1]",
    prefer = { "aromatic electrophilic", carbon = 1 },
    conditions = "br2",
    also_attacks = { "alkene", "phenol", "primary amine", "sulfide", "other electron-rich arene" },
    recipe = "SO2Cl2, CH2Cl2 or AcOH; NCS, MeCN; Cl2",
    yield = { 60, 90 },
    cautions = { "sulfuryl chloride", "chlorine" },
    source = "March's Advanced Organic Chemistry; from memory",
    example { "CCOC(=O)c1ccc(OC)c(Cl)c1", from = { "CCOC(=O)c1ccc(OC)cc1" } },
    example { "CC(=O)Nc1ccc(Cl)cc1", from = { "CC(=O)Nc1ccccc1" } },
    refuse { "CC(=O)Nc1cccc(Cl)c1" }, -- meta to a donor
}

interconversion "iodination-directed" {
    about = "Iodination of an electron-rich arene; para to O or N donors",
    target = "[c;" .. BENZENE .. ";$(c:c-" .. STRONG .. "),$(c1:c:c:c(-" .. STRONG .. "):c:c:1):1]-I",
    from = "[cH:1]",
    prefer = { "aromatic electrophilic", carbon = 1 },
    conditions = "br2",
    also_attacks = { "alkene", "phenol", "thiol", "other electron-rich arene" },
    recipe = "I2, AgOAc or HIO3; NIS, TFA; ICl, AcOH",
    yield = { 65, 90 },
    cautions = { "iodine monochloride" },
    source = "Vogel's Textbook of Practical Organic Chemistry; from memory",
    example { "COc1ccc(I)cc1C(=O)OC", from = { "COC(=O)c1ccccc1OC" } },
    example { "COc1ccc(I)cc1", from = { "COc1ccccc1" } },
    refuse { "COc1cccc(I)c1" }, -- meta to the donor
}

interconversion "sulfonation" {
    about = "Sulfonation of an arene; para (thermodynamic), reversible",
    target = "[c;$(c:c-" .. GIVE .. "),$(c1:c:c:c(-" .. GIVE ..
        "):c:c:1),$(c1(-*):[cH]:[cH]:[cH]:[cH]:[cH]:1):1]-[SX4:2](=[OX1:3])(=[OX1:4])-[OX2H1:5]",
    from = "[cH:1].[S:2](=[O:3])(=[O:4])=[O:5]",
    prefer = { "aromatic electrophilic", carbon = 1 },
    conditions = "so3",
    also_attacks = { "free alcohol", "alkene", "acid-labile acetal", "primary amine" },
    recipe = "H2SO4 or oleum, 25-100 °C",
    yield = { 60, 90 },
    cautions = { "oleum", "sulfuric acid" },
    source = "Vogel's Textbook of Practical Organic Chemistry; from memory",
    example { "Cc1ccc(S(=O)(=O)O)c(C)c1", from = { "Cc1cccc(C)c1", "O=S(=O)=O" } },
    example { "Cc1ccc(S(=O)(=O)O)cc1", from = { "Cc1ccccc1", "O=S(=O)=O" } },
    refuse { "COc1cccc(S(=O)(=O)O)c1" }, -- meta to the donor
}

interconversion "chlorosulfonation" {
    about = "Chlorosulfonation of an arene; para to the donor",
    target = "[c;$(c:c-" .. GIVE .. "),$(c1:c:c:c(-" .. GIVE ..
        "):c:c:1),$(c1(-*):[cH]:[cH]:[cH]:[cH]:[cH]:1):1]-[SX4:2](=[OX1:3])(=[OX1:4])-Cl",
    from = "[cH:1].O[S:2](=[O:3])(=[O:4])Cl",
    prefer = { "aromatic electrophilic", carbon = 1 },
    conditions = "so3",
    also_attacks = { "free alcohol", "primary amine", "alkene", "acid-labile acetal", "ester" },
    recipe = "ClSO3H (excess), 0-80 °C",
    yield = { 65, 85 },
    cautions = { "chlorosulfonic acid" },
    source = "Vogel's Textbook of Practical Organic Chemistry; from memory",
    example { "CC(=O)Nc1ccc(S(=O)(=O)Cl)cc1", from = { "CC(=O)Nc1ccccc1", "O=S(=O)(O)Cl" } },
    example { "COc1ccc(S(=O)(=O)Cl)cc1", from = { "COc1ccccc1", "O=S(=O)(O)Cl" } },
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
    prefer = { "aromatic electrophilic, bulky", carbon = 1 },
    conditions = "lewis-acid",
    also_attacks = { "free alcohol", "primary amine", "alkene", "other electron-rich arene",
        "acid-labile acetal" },
    recipe = "AlCl3 or FeCl3, CH2Cl2, 0 °C; also: alcohol or alkene with H2SO4",
    yield = { 55, 85 },
    cautions = { "aluminium chloride" },
    source = "Clayden, Greeves, Warren, Organic Chemistry; from memory",
    example { "COc1ccc(C(C)(C)C)cc1", from = { "COc1ccccc1", "CC(C)(C)Cl" } },
    example { "CC(C)(C)c1ccccc1", from = { "c1ccccc1", "CC(C)(C)Cl" } },
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
    example { "C(c1ccccc1)c1ccccc1", from = { "c1ccccc1", "ClCc1ccccc1" } },
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
    prefer = { "aromatic electrophilic, bulky", carbon = 1 },
    conditions = "lewis-acid",
    also_attacks = { "free alcohol", "primary amine", "alkene", "other electron-rich arene",
        "acid-labile acetal" },
    recipe = "AlCl3 (1.1 equiv.), CH2Cl2 or PhNO2, 0-25 °C; also: anhydride",
    yield = { 70, 95 },
    cautions = { "aluminium chloride" },
    source = "Clayden, Greeves, Warren, Organic Chemistry; from memory",
    example { "CC(=O)c1ccc(CC(C)C)cc1", from = { "CC(C)Cc1ccccc1", "CC(=O)Cl" } },
    example { "O=C(c1ccccc1)c1ccccc1", from = { "c1ccccc1", "O=C(Cl)c1ccccc1" } },
    refuse { "CC(=O)c1cccc([N+](=O)[O-])c1" }, -- nitrobenzene is a solvent for the reaction, not a substrate
}

disconnection "vilsmeier" {
    about = "Vilsmeier-Haack formylation; C3 of indole, C2 of pyrrole and thiophene, para to NR2",
    rxno = "RXNO:0000055",
    target = "[c;$(c1:c:c:c(-[NX3;H0;+0]):c:c:1),$([c;R1]1:[c;R1]:[nX3]:c:c1),$([c;R1]1:[nX3,s]:[c;R1]:[c;R1]:[c;R1]1):1]-[CX3;H1:2]=[OX1:3]",
    cut = { 2, 1 },
    acceptor = { 2, "formyl" },
    donor = { 1, "arene" },
    prefer = { "aromatic electrophilic", carbon = 1 },
    conditions = "acylation",
    also_attacks = { "free alcohol", "free acid", "primary amine", "enolisable ketone", "primary amide" },
    recipe = "POCl3, DMF, 0-80 °C, then aq. NaOAc; also: N-methylformanilide",
    yield = { 65, 95 },
    cautions = { "phosphoryl chloride" },
    source = "Joule, Mills, Heterocyclic Chemistry; from memory",
    example { "COc1ccc2[nH]cc(C=O)c2c1", from = { "COc1ccc2[nH]ccc2c1", "CN(C)C=O" } },
    example { "CN(C)c1ccc(C=O)cc1", from = { "CN(C)c1ccccc1", "CN(C)C=O" } },
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
    example { "O=Cc1ccccc1O", from = { "Oc1ccccc1", "ClC(Cl)Cl" } },
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
    example { "OC(=O)c1ccccc1O", from = { "Oc1ccccc1", "O=C=O" } },
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
    example { "Cc1ccc(Cl)cc1", from = { "Cc1ccc(N)cc1" } },
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
    example { "Cc1ccccc1Br", from = { "Cc1ccccc1N" } },
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
    example { "Cc1ccccc1C#N", from = { "Cc1ccccc1N", "[Na+].[C-]#N" } },
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
    example { "Fc1ccccc1", from = { "Nc1ccccc1" } },
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
    example { "Ic1ccccc1", from = { "Nc1ccccc1" } },
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
    example { "Oc1cccc(Br)c1", from = { "Nc1cccc(Br)c1" } },
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
    example { "Brc1cc(Br)cc(Br)c1", from = { "Nc1c(Br)cc(Br)cc1Br" } },
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
    example { "O=[N+]([O-])c1ccc(cc1)N1CCCCC1", from = { "O=[N+]([O-])c1ccc(F)cc1", "C1CCNCC1" } },
    refuse { "CN(C)c1cccc([N+](=O)[O-])c1" }, -- the nitro group is meta: no stabilisation of the adduct
}

disconnection "snar-azine-amine" {
    about = "SNAr of a chloroazine by an amine; 4- over 2-position in pyrimidines and quinazolines",
    target = "[c;" .. AZINE .. ";r6:1]-!@[NX3;+0;!$(N-[C,S]=[O,N,S]);!$(N=*):2]-[#6:3]",
    cut = { 1, 2 },
    acceptor = { 1, "activated-aryl" },
    donor = { 2, "amine" },
    conditions = "amine-heat",
    also_attacks = { "other chloroazine", "alkyl halide", "acyl halide", "activated ester" },
    recipe = "iPrOH or MeCN, reflux, DIPEA or HCl cat.; also: F, SMe, SO2Me",
    yield = { 70, 95 },
    source = "Joule, Mills, Heterocyclic Chemistry; from memory",
    example { "COc1cc2ncnc(Nc3cccc(Cl)c3F)c2cc1OC", from = { "COc1cc2ncnc(Cl)c2cc1OC", "Nc1cccc(Cl)c1F" } },
    example { "c1ccnc(n1)N1CCNCC1", from = { "Clc1ncccn1", "C1CNCCN1" } },
    refuse { "CNc1cccnc1" }, -- the 3-position of pyridine is not activated
}

disconnection "snar-alkoxide" {
    about = "SNAr by an alkoxide; ipso",
    also = { "snar-chloroazine-alkoxide" },
    target = "[c;$(c:c-" .. ACTIVATE .. "),$(c1:c:c:c(-" .. ACTIVATE ..
        "):c:c:1)," .. AZINE .. ":1]-!@[OX2:2]-[CX4:3]",
    cut = { 1, 2 },
    acceptor = { 1, "activated-aryl" },
    donor = { 2, "alcohol" },
    conditions = "alkoxide",
    also_attacks = { "thiol", "primary amine", "ester", "aldehyde", "alkyl halide", "acyl halide", "other activated aryl fluoride" },
    recipe = "NaH, THF or DMF, 0-60 °C; KOtBu; also: Cl",
    yield = { 70, 95 },
    cautions = { "sodium hydride" },
    source = "Clayden, Greeves, Warren, Organic Chemistry; from memory",
    example { "O=[N+]([O-])c1ccc(OCC2CCCO2)cc1", from = { "O=[N+]([O-])c1ccc(F)cc1", "OCC1CCCO1" } },
    example { "COc1ccc([N+](=O)[O-])cc1", from = { "Clc1ccc([N+](=O)[O-])cc1", "CO" } },
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
    also_attacks = { "primary amine", "alkyl halide", "acyl halide", "enone", "epoxide", "other activated aryl halide" },
    recipe = "K2CO3, DMF, 25-80 °C; also: F, Br",
    yield = { 75, 95 },
    cautions = { "thiol (stench)" },
    source = "Carey, Sundberg, Advanced Organic Chemistry Part B; from memory",
    example { "CCSc1ccc([N+](=O)[O-])cc1C#N", from = { "N#Cc1cc([N+](=O)[O-])ccc1Cl", "CCS" } },
    example { "O=[N+]([O-])c1ccc(Sc2ccccc2)cc1", from = { "O=[N+]([O-])c1ccc(Cl)cc1", "Sc1ccccc1" } },
    refuse { "CSc1cccc([N+](=O)[O-])c1" }, -- the nitro group is meta
}

disconnection "snar-phenoxide" {
    about = "Diaryl ether by SNAr; ipso",
    also = { "snar-chloroazine-phenoxide" },
    target = "[c;$(c:c-" .. ACTIVATE .. "),$(c1:c:c:c(-" .. ACTIVATE .. "):c:c:1)," .. AZINE .. ":1]-!@[OX2:2]-[c:3]",
    cut = { 1, 2 },
    acceptor = { 1, "activated-aryl" },
    donor = { 2, "phenol" },
    conditions = "base-aq-mild",
    also_attacks = { "thiol", "primary amine", "secondary amine", "alkyl halide", "acyl halide", "other activated aryl halide" },
    recipe = "K2CO3, DMF or DMSO, 80-140 °C; also: Cl, NO2",
    yield = { 75, 95 },
    source = "Carey, Sundberg, Advanced Organic Chemistry Part B; from memory",
    example { "N#Cc1ccc(Oc2ccc(Cl)cc2)cc1", from = { "N#Cc1ccc(F)cc1", "Oc1ccc(Cl)cc1" } },
    example { "O=[N+]([O-])c1ccc(Oc2ccccc2)cc1", from = { "O=[N+]([O-])c1ccc(F)cc1", "Oc1ccccc1" } },
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
    example { "O=[N+]([O-])c1ccc(CBr)cc1", from = { "Cc1ccc([N+](=O)[O-])cc1" } },
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
    example { "OC(=O)c1ccccc1Cl", from = { "Cc1ccccc1Cl" } },
    refuse { "O=C(O)Cc1ccccc1" }, -- the chain is cut to one carbon, never to two
}

-- Arenes whose ketones Friedel-Crafts acylation gives, and the CH2 of a chain or of a benzo ring that it closes.
local ARYL = "c;$(c1ccccc1),$(c1cccs1),$(c1ccsc1)"
local CHAIN = "!R,$(C1c:c[CX4,c][CX4]1),$(C1c:c[CX4,c][CX4][CX4]1),$(C1c:c[CX4,c][CX4][CX4][CX4]1)"

interconversion "clemmensen" {
    about = "Clemmensen reduction of an aryl ketone; C=O to CH2; acid-stable substrates",
    rxno = "RXNO:0000038",
    target = "[" .. ARYL .. ":1]-[CX4;H2;" .. CHAIN .. ":2]-[CX4;!$(C-[!#6;!#1]);!$(C-[CX3]=O);!$(C-C#N):3]",
    from = "[c:1][C:2](=O)[C:3]",
    conditions = "clemmensen",
    also_attacks = { "primary amide", "imide", "nitro", "alkene", "acid-labile acetal", "free alcohol", "other ketone" },
    recipe = "Zn(Hg), conc. HCl, toluene, reflux; also: Et3SiH, TFA",
    yield = { 60, 85 },
    cautions = { "zinc amalgam (mercury)", "hydrochloric acid" },
    source = "Vogel's Textbook of Practical Organic Chemistry; from memory",
    example { "O=C(O)CCCc1ccc(F)cc1", from = { "O=C(O)CCC(=O)c1ccc(F)cc1" } },
    example { "CCCc1ccccc1", from = { "CCC(=O)c1ccccc1" } },
    refuse { "NCCc1ccccc1" }, -- an α-amino ketone is cleaved at the C-N bond
}

interconversion "wolff-kishner" {
    about = "Wolff-Kishner reduction of a ketone; C=O to CH2; base-stable substrates (Huang-Minlon)",
    rxno = "RXNO:0000227",
    target = "[" .. ARYL .. ":1]-[CX4;H2;" .. CHAIN ..
        ":2]-[#6;$([CX4;!$(C-[!#6;!#1])]),$(c);!$([CX4]-[CX3]=O);!$(C-C#N);!$([CX4]-[CX4]-[NX3,OX2]):3]",
    from = "[c:1][C:2](=O)[#6:3]",
    conditions = "wolff-kishner",
    also_attacks = { "ester", "nitrile", "alkyl halide", "nitro", "activated aryl halide", "other ketone",
        "aldehyde" },
    recipe = "N2H4·H2O, KOH, diethylene glycol, 180-200 °C",
    yield = { 65, 90 },
    cautions = { "hydrazine", "potassium hydroxide" },
    source = "Vogel's Textbook of Practical Organic Chemistry; from memory",
    example { "CN(C)c1ccc(CCC2CCCCC2)cc1", from = { "CN(C)c1ccc(C(=O)CC2CCCCC2)cc1" } },
    example { "c1ccc2CCCCc2c1", from = { "O=C1CCCc2ccccc12" } },
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
    example { "CCOc1cc(C=O)ccc1O", from = { "CCOc1cc(ccc1O)C(O)C(=O)O" } },
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
    example { "CC(=O)OC(OC(C)=O)c1ccc(cc1)[N+](=O)[O-]", from = { "Cc1ccc(cc1)[N+](=O)[O-]", "CC(=O)OC(C)=O" } },
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
    example { "CC(=O)c1ccccc1", from = { "c1ccccc1", "CC(=O)OC(C)=O" } },
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
    example { "O=C(c1ccccc1)c1ccc(cc1)-c1ccccc1", from = { "c1ccc(cc1)-c1ccccc1", "O=C(Cl)c1ccccc1" } },
    refuse { "CC(=O)c1cccc(-c2ccccc2)c1" }, -- meta to the other ring
}

-- What the lost amino group put in place: an ortho halogen or nitro group beside a para alkyl group.
interconversion "deamination-para-methyl" {
    about = "Reductive deamination of an aniline that had put a halogen ortho to itself, para to an alkyl group",
    also = { "deamination-para-alkyl" },
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
    example { "Cc1cccc([N+](=O)[O-])c1", from = { "Cc1ccc(N)c([N+](=O)[O-])c1" } },
    refuse { "Cc1ccccc1" }, -- no group that the amine would have directed
}
