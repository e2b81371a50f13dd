-- Rings with nitrogen, oxygen and sulfur.
-- Yields are typical ranges and sources stand from memory unless a source says otherwise.

pack {
    name = "heterocycles",
    version = "0.1.0",
    licence = "CC0-1.0",
    about = "Rings with nitrogen, oxygen and sulfur",
    needs = { "synthons" },
}

disconnection "fischer-indole" {
    about = "Fischer indole synthesis; more substituted enehydrazine in acid; meta-substituted arylhydrazines give two indoles",
    rxno = "RXNO:0000064",
    target = "[nX3;+0:1]1:[c;$(c1ccccc1):2]:[c;$(c1ccccc1):3]:[c:4]:[c;$(c-[#6]):5]:1",
    from = "[N:1](N)-[c:2]:[cH:3].O=[C:5]-[C:4]",
    conditions = "acid-aq-strong",
    also_attacks = { "acid-labile acetal", "other ketone", "aldehyde", "tert-butyl ester", "Boc carbamate" },
    recipe = "AcOH or HCl/EtOH reflux, ZnCl2, PPA",
    yield = { 55, 90 },
    cautions = { "arylhydrazine" },
    source = "Joule, Mills, Heterocyclic Chemistry; from memory",
    example { "COc1ccc2[nH]c3c(c2c1)CCCC3", from = { "COc1ccc(NN)cc1", "O=C1CCCCC1" } },
    refuse { "c1ccc2[nH]ccc2c1" }, -- from acetaldehyde: the parent indole does not form so
}

disconnection "paal-knorr-pyrrole" {
    about = "Paal-Knorr pyrrole synthesis; 2,5-disubstituted",
    rxno = "RXNO:0000164",
    target = "[nX3;+0;R1:1]1:[c;$(c-[#6]);R1:2]:[c;R1:3]:[c;R1:4]:[c;$(c-[#6]);R1:5]:1",
    from = "[N:1].O=[C:2]-[C:3]-[C:4]-[C:5]=O",
    conditions = "acid-aq-mild",
    also_attacks = { "other primary amine", "aldehyde", "acid-labile acetal" },
    recipe = "AcOH or TsOH cat., toluene or EtOH, reflux; NH4OAc for NH",
    yield = { 70, 95 },
    source = "Joule, Mills, Heterocyclic Chemistry; from memory",
    example { "Cc1ccc(C)n1CCc1ccc(O)cc1", from = { "NCCc1ccc(O)cc1", "CC(=O)CCC(C)=O" } },
    refuse { "Cc1cc2ccccc2[nH]1" }, -- an indole: no 1,4-diketone stands for it
}

disconnection "knorr-pyrazole" {
    about = "Knorr pyrazole synthesis; arylhydrazine: terminal N to the more reactive C=O; aryl next to N-aryl in EtOH/HCl",
    rxno = "RXNO:0000391",
    target = "[nX3;+0;R1:1]1:[nX2;+0;R1:2]:[c;R1:3]:[c;R1:4]:[c;R1;$(c-[#6]):5]:1",
    from = "[N:1]-[N:2].O=[C:3]-[C:4]-[C:5]=O",
    conditions = "acid-aq-mild",
    also_attacks = { "aldehyde", "other ketone", "alkyl halide", "acyl halide" },
    recipe = "hydrazine (HCl salt), EtOH, reflux",
    yield = { 65, 95 },
    cautions = { "hydrazine" },
    source = "Joule, Mills, Heterocyclic Chemistry; from memory",
    example { "Cc1ccc(-c2cc(C(F)(F)F)nn2-c2ccc(S(N)(=O)=O)cc2)cc1", from = { "NNc1ccc(S(N)(=O)=O)cc1", "Cc1ccc(C(=O)CC(=O)C(F)(F)F)cc1" } },
    refuse { "c1ccc2[nH]ncc2c1" }, -- an indazole
}

disconnection "hantzsch-thiazole" {
    about = "Hantzsch thiazole synthesis; S to the CH-X carbon, N to the carbonyl carbon",
    target = "[s:1]1:[c;R1;$(c-[#6,#7]):2]:[nX2:3]:[c;R1;$(c-[#6]):4]:[c;R1:5]:1",
    from = "[S:1]=[C:2]-[N:3].O=[C:4]-[C:5]Br",
    conditions = "amine-heat",
    also_attacks = { "other alkyl halide", "primary amine", "thiol" },
    recipe = "EtOH, reflux, base to liberate; also: α-chloro ketone; thiourea for 2-amino",
    yield = { 70, 95 },
    cautions = { "α-bromo ketone (lachrymator)" },
    source = "Joule, Mills, Heterocyclic Chemistry; from memory",
    example { "CCOC(=O)c1sc(-c2ccc(O)cc2)nc1C", from = { "NC(=S)c1ccc(O)cc1", "CCOC(=O)C(Br)C(C)=O" } },
    refuse { "c1ccc2scnc2c1" }, -- a benzothiazole
}

disconnection "hantzsch-dihydropyridine" {
    about = "Hantzsch dihydropyridine synthesis; symmetrical; unsymmetrical ones from enaminoester and Knoevenagel product",
    rxno = "RXNO:0000268",
    target = "[NX3;H1:1]1-[CX3:2]=[CX3;$(C-[$([CX3]=O),$(C#N)]):3]-[CX4;H1,H2:4]-[CX3;$(C-[$([CX3]=O),$(C#N)]):5]=[CX3:6]-1",
    from = "[N:1].O=[C:2]-[C:3].O=[C:4].[C:5]-[C:6]=O",
    conditions = "amine-heat",
    also_attacks = { "other aldehyde", "acyl halide", "alkyl halide" },
    recipe = "NH4OAc or aq. NH3, EtOH, reflux",
    yield = { 60, 90 },
    source = "Joule, Mills, Heterocyclic Chemistry; from memory",
    example { "COC(=O)C1=C(C)NC(C)=C(C(=O)OC)C1c1ccccc1[N+](=O)[O-]", from = { "N", "COC(=O)CC(C)=O", "O=Cc1ccccc1[N+](=O)[O-]", "COC(=O)CC(C)=O" } },
    refuse { "C1C=CNC=C1" }, -- no acceptors at C3 and C5
}

disconnection "flavone-cyclodehydration" {
    about = "Flavone by cyclodehydration of a 1-(2-hydroxyphenyl)-1,3-diketone; no isomers to expect",
    target = "[o:1]1:[c;$(c1ccccc1):2]:[c;$(c1ccccc1):3]:[c:4](=[O:5]):[c:6]:[c:7]1[#6:8]",
    from = "[O;H1:1]-[c:2]:[c:3]-[C:4](=[O:5])-[C:6]-[C:7](=O)[#6:8]",
    conditions = "acid-aq-strong",
    also_attacks = { "acetal", "tertiary alcohol", "Boc carbamate" },
    recipe = "H2SO4 (cat.), AcOH, 100 °C; also: HCl/EtOH, I2/DMSO",
    yield = { 80, 95 },
    cautions = { "sulfuric acid" },
    source = "Kürti and Czakó, Strategic Applications of Named Reactions in Organic Synthesis; from memory",
    example { "COc1ccc(cc1)-c1cc(=O)c2ccccc2o1", from = { "COc1ccc(cc1)C(=O)CC(=O)c1ccccc1O" } },
    refuse { "O=c1ccoc2ccccc12" }, -- no substituent at C2
}

disconnection "oxazolidinone-amino-alcohol" {
    about = "Oxazolidinone from a 1,2-amino alcohol; configuration kept",
    target = "[O:1]1[C;X3:2](=[O:3])[N:4][C;X4:5][C;X4:6]1",
    from = "[O;H1:1][C:6][C:5][N:4].[C:2](=[O:3])(OCC)OCC",
    conditions = "base-aq-mild",
    also_attacks = { "other primary amine", "other alcohol", "phenol", "thiol" },
    recipe = "diethyl carbonate, K2CO3, 130 °C, ethanol distilled off; also: CDI, triphosgene",
    yield = { 80, 95 },
    source = "Carey and Sundberg, Advanced Organic Chemistry, Part B; from memory",
    example { "O=C1N[C@@H](Cc2ccccc2)CO1", from = { "N[C@H](CO)Cc1ccccc1", "CCOC(=O)OCC" } },
    refuse { "O=C1NCCN1" }, -- a cyclic urea
}

disconnection "biltz-hydantoin" {
    about = "5,5-Diarylhydantoin from a benzil and urea (Biltz); one aryl group migrates",
    target = "[N;H1:1]1[C;X3:2](=[O:3])[N;H1:4][C;X3:5](=[O:6])[C;X4:7]1([c:8])[c:9]",
    from = "[N;H2:1][C:2](=[O:3])[N;H2:4].O=[C:7]([c:8])[C:5](=[O:6])[c:9]",
    conditions = "base-aq-strong",
    also_attacks = { "ester", "alkyl halide", "acyl halide", "aldehyde" },
    recipe = "KOH, EtOH, reflux, then acid",
    yield = { 60, 85 },
    cautions = { "potassium hydroxide" },
    source = "Vogel's Textbook of Practical Organic Chemistry; from memory",
    example { "O=C1NC(=O)C(N1)(c1ccc(F)cc1)c1ccc(F)cc1", from = { "NC(N)=O", "O=C(C(=O)c1ccc(F)cc1)c1ccc(F)cc1" } },
    refuse { "CC1(c2ccccc2)NC(=O)NC1=O" }, -- only one aryl group: Bucherer-Bergs
}

disconnection "thiouracil" {
    about = "2-Thiouracil from thiourea and a β-keto ester; no isomers to expect",
    rxno = "RXNO:0000400",
    target = "[nH:1]1:[c:2](=[S:3]):[nH:4]:[c:5]([#6:9]):[c:6]:[c:7]1=[O:8]",
    from = "[N;H2:1][C:2](=[S:3])[N;H2:4].O=[C:5]([#6:9])[C:6][C:7](=[O:8])OCC",
    conditions = "alkoxide",
    also_attacks = { "alkyl halide", "acyl halide", "aldehyde", "other ester" },
    recipe = "NaOEt, EtOH, reflux, then acid; also: urea for uracils",
    yield = { 70, 90 },
    cautions = { "thiourea" },
    source = "Kleemann and Engel, Pharmaceutical Substances; from memory",
    example { "CCCc1cc(=O)[nH]c(=S)[nH]1", from = { "NC(N)=S", "CCCC(=O)CC(=O)OCC" } },
    refuse { "O=c1ccccn1C" }, -- a pyridone
}

disconnection "pyrazolone" {
    about = "Pyrazolone from an arylhydrazine and a β-keto ester (Knorr); terminal NH2 to the ketone, NH to the ester",
    target = "[N:1]1([c:6])[N:2]=[C:3]([#6:8])[C;X4;H1,H2:4][C;X3:5]1=[O:7]",
    from = "[N;H1:1]([c:6])[N;H2:2].O=[C:3]([#6:8])[C:4][C:5](=[O:7])OCC",
    conditions = "acid-hot-dry",
    also_attacks = { "other ketone", "aldehyde", "acyl halide", "imide" },
    recipe = "AcOH or EtOH, reflux",
    yield = { 75, 93 },
    source = "Joule and Mills, Heterocyclic Chemistry; from memory",
    example { "CC1=NN(C(=O)C1)c1ccc(C)c(C)c1", from = { "Cc1ccc(NN)cc1C", "CCOC(=O)CC(C)=O" } },
    refuse { "CC1=NNC(C)(C)C1" }, -- a pyrazoline
}

interconversion "fischer-indole-from-hydrazone" {
    about = "Fischer indole synthesis from the isolated hydrazone; the less hindered carbon ends up as C3 in weak acid",
    target = "[nX3;H1:1]1:[c;$(c1ccccc1):2]:[c;$(c1ccccc1):3]:[c:4]([#6:6]):[c:5]([#6:7]):1",
    from = "[NX3;H1:1](-[c:2]:[cH:3])N=[C:5]([#6:7])[C:4][#6:6]",
    conditions = "acid-aq-strong",
    also_attacks = { "acetal", "tert-butyl ester", "Boc group" },
    recipe = "HCl or H2SO4, EtOH, reflux; or ZnCl2, AcOH",
    yield = { 60, 85 },
    cautions = { "hydrochloric acid" },
    source = "Fischer, Jourdan, Ber. Dtsch. Chem. Ges. 1883, 16, 2241; from memory",
    example { "COC(=O)Cc1c(C)[nH]c2ccc(OC)cc12", from = { "COC(=O)CCC(C)=NNc1ccc(OC)cc1" } },
    refuse { "c1ccc2[nH]ccc2c1" }, -- the parent indole does not form
}

disconnection "hantzsch-thiazole-chloride" {
    about = "Hantzsch thiazole synthesis with an α-chloro ketone or chloroacetaldehyde; S to the carbon that bears Cl",
    target = "[s;R1:1]1:[c;R1;$(c-[#6,#7]):2]:[nX2:3]:[c;R1:4]:[c;R1:5]:1",
    from = "[S:1]=[C:2]-[N:3].O=[C:4]-[C:5]Cl",
    conditions = "amine-heat",
    also_attacks = { "other alkyl halide", "primary amine", "thiol" },
    recipe = "water or EtOH, warm, then base; thiourea gives the 2-amine, a thioamide the 2-alkyl compound",
    yield = { 65, 92 },
    cautions = { "chloroacetaldehyde" },
    source = "Joule, Mills, Heterocyclic Chemistry; from memory",
    example { "Nc1nccs1", from = { "NC(N)=S", "O=CCCl" } },
    example { "Cc1csc(N)n1", from = { "NC(N)=S", "CC(=O)CCl" } },
    refuse { "c1ccc2scnc2c1" }, -- a benzothiazole
}

disconnection "pyrazolone-n-methylation" {
    about = "Methylation of a pyrazolone at N2; O and C4 compete under basic conditions",
    target = "[nX3:1]1(-[CX4;H3:2]):[c:3](-[#6:4]):[c:5]:[c:6](=[OX1:7]):[nX3:8]1-[c:9]",
    from = "[N:1]1=[C:3](-[#6:4])[C:5][C:6](=[O:7])[N:8]1-[c:9].I[C:2]",
    conditions = "alkylation",
    also_attacks = { "primary amine", "thiol", "phenol", "free acid" },
    recipe = "MeI, MeOH, 100 °C (sealed), or Me2SO4, NaOH, 80 °C",
    yield = { 65, 88 },
    cautions = { "iodomethane" },
    source = "Knorr, Ber. Dtsch. Chem. Ges. 1884, 17, 546; from memory",
    example { "Cc1cc(=O)n(-c2ccccc2)n1C", from = { "CC1=NN(c2ccccc2)C(=O)C1", "CI" } },
    example { "Cc1c(C(C)C)c(=O)n(-c2ccccc2)n1C", from = { "CC1=NN(c2ccccc2)C(=O)C1C(C)C", "CI" } },
    refuse { "Cc1cc(=O)[nH]n1C" }, -- no aryl group on N1
}

disconnection "diaminopyrimidine-from-benzylidene-nitrile" {
    about = "5-Benzyl-2,4-diaminopyrimidine from guanidine and a 2-alkoxymethyl cinnamonitrile; base moves the double bond first",
    target = "[n:1]1:[c:2](-[NX3;H2:3]):[n:4]:[cH:5]:[c:6](-[CX4;H2:9]-[c:10]):[c:7]1-[NX3;H2:8]",
    from = "[NH:1]=[C:2]([N:3])[NH2:4].CO[C:5][C:6](=[C:9]-[c:10])[C:7]#[N:8]",
    conditions = "alkoxide",
    also_attacks = { "ester", "alkyl halide", "acyl halide", "aldehyde" },
    recipe = "guanidine (from its salt and NaOMe), MeOH, reflux",
    yield = { 60, 85 },
    cautions = { "sodium methoxide" },
    source = "Stenbuck, Baltzly, Hood, J. Org. Chem. 1963, 28, 1983; from memory",
    example { "COc1cc(Cc2cnc(N)nc2N)cc(OC)c1OC", from = { "N=C(N)N", "COCC(C#N)=Cc1cc(OC)c(OC)c(OC)c1" } },
    example { "Nc1ncc(Cc2ccccc2)c(N)n1", from = { "N=C(N)N", "COCC(C#N)=Cc1ccccc1" } },
    refuse { "Nc1ncc(-c2ccccc2)c(N)n1" }, -- no CH2 between the rings
}

disconnection "succinimide-from-diacid" {
    about = "Five-membered imide from a diacid and ammonia",
    target = "[NX3;H1;r5:1]1-[CX3:2](=[OX1:3])-[CX4:4]-[CX4:5]-[CX3:6](=[OX1:7])-1",
    from = "[N:1].O[C:2](=[O:3])[C:4][C:5][C:6](=[O:7])O",
    conditions = "heat-200",
    also_attacks = { "ester", "aldehyde", "ketone", "acyl halide" },
    recipe = "conc. aq. NH3, then 180-200 °C; also: urea melt",
    yield = { 65, 88 },
    cautions = { "ammonia" },
    source = "Kleemann and Engel, Pharmaceutical Substances; from memory",
    example { "CCC1(C)CC(=O)NC1=O", from = { "N", "CCC(C)(CC(=O)O)C(=O)O" } },
    example { "O=C1CCC(=O)N1", from = { "N", "OC(=O)CCC(=O)O" } },
    refuse { "O=C1CCCN1" }, -- a lactam: one carbonyl group only
}

disconnection "inverse-demand-dihydropyran" {
    about = "2-Alkoxy-3,4-dihydro-2H-pyran from an enal and a vinyl ether (hetero Diels-Alder reaction with inverse demand)",
    target = "[OX2:1]1[CX4;H1:2]([OX2:8][CX4:9])[CX4;H2:3][CX4:4][CX3:5]=[CX3;H1:6]1",
    from = "[O:1]=[C:6][C:5]=[C:4].[C:3]=[C:2][O:8][C:9]",
    conditions = "heat-200",
    also_attacks = { "other enal", "conjugated diene", "primary amine", "thiol" },
    recipe = "neat, 160-190 °C under pressure, hydroquinone; also: ZnCl2 or Eu(fod)3, lower temperature",
    yield = { 70, 90 },
    cautions = { "acrolein" },
    source = "Longley, Emerson, J. Am. Chem. Soc. 1950, 72, 3079; from memory",
    example { "CCOC1CCC=CO1", from = { "C=CC=O", "C=COCC" } },
    example { "CCOC1CC(C)C=CO1", from = { "CC=CC=O", "C=COCC" } },
    refuse { "C1CC=COC1" }, -- no alkoxy group from a vinyl ether
}
