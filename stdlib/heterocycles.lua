-- Rings with nitrogen, oxygen and sulfur.
-- Yields are typical ranges and sources stand from memory unless a source says otherwise.

pack {
    name = "heterocycles",
    version = "0.1.0",
    licence = "CC0-1.0",
    about = "Rings with nitrogen, oxygen and sulfur",
    needs = { "synthons", "preferences" },
}

disconnection "fischer-indole" {
    about = "Fischer indole synthesis; more substituted enehydrazine in acid; meta-substituted arylhydrazines give two indoles",
    rxno = "RXNO:0000064",
    target = "[nX3;+0:1]1:[c;$(c1ccccc1):2]:[c;$(c1ccccc1):3]:[c:4]:[c;$(c-[#6]):5]:1",
    from = "[N:1](N)-[c:2]:[cH:3].O=[C:5]-[C:4]",
    prefer = { "thermodynamic enolate", carbon = 4, new = 3 },
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
    target = "[s;R1:1]1:[c;R1;$(c-[#6,#7]),H1:2]:[nX2:3]:[c;R1:4]:[c;R1:5]:1",
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
    also_attacks = { "other enone", "conjugated diene", "primary amine", "thiol" },
    recipe = "neat, 160-190 °C under pressure, hydroquinone; also: ZnCl2 or Eu(fod)3, lower temperature",
    yield = { 70, 90 },
    cautions = { "acrolein" },
    source = "Longley, Emerson, J. Am. Chem. Soc. 1950, 72, 3079; from memory",
    example { "CCOC1CCC=CO1", from = { "C=CC=O", "C=COCC" } },
    example { "CCOC1CC(C)C=CO1", from = { "CC=CC=O", "C=COCC" } },
    refuse { "C1CC=COC1" }, -- no alkoxy group from a vinyl ether
}

disconnection "paal-knorr-furan" {
    about = "Paal-Knorr furan synthesis; 2,5-disubstituted",
    rxno = "RXNO:0000162",
    target = "[o;R1:1]1:[c;$(c-[#6]);R1:2]:[c;R1:3]:[c;R1:4]:[c;$(c-[#6]);R1:5]:1",
    from = "[O:1]=[C:2]-[C:3]-[C:4]-[C:5]=O",
    conditions = "acid-hot-dry",
    also_attacks = { "free alcohol", "primary amine", "alkene" },
    recipe = "TsOH, toluene, reflux, or conc. H2SO4 or P2O5",
    yield = { 60, 90 },
    source = "Joule, Mills, Heterocyclic Chemistry; from memory",
    example { "COc1ccc(-c2ccc(C)o2)cc1", from = { "COc1ccc(C(=O)CCC(C)=O)cc1" } },
    example { "Cc1ccc(C)o1", from = { "CC(=O)CCC(C)=O" } },
    refuse { "c1ccc2occc2c1" }, -- a benzofuran
}

disconnection "paal-knorr-thiophene" {
    about = "Paal-Knorr thiophene synthesis; 2,5-disubstituted; sulfur from the reagent",
    rxno = "RXNO:0000163",
    target = "s1:[c;$(c-[#6]);R1:2]:[c;R1:3]:[c;R1:4]:[c;$(c-[#6]);R1:5]:1",
    from = "O=[C:2]-[C:3]-[C:4]-[C:5]=O",
    conditions = "heat-200",
    also_attacks = { "free alcohol", "amide", "ester", "aldehyde", "other ketone" },
    recipe = "Lawesson's reagent, toluene, 110 °C, or P4S10",
    yield = { 60, 90 },
    cautions = { "phosphorus pentasulfide", "Lawesson's reagent (stench)" },
    source = "Joule, Mills, Heterocyclic Chemistry; from memory",
    example { "Cc1ccc(-c2ccc(Br)cc2)s1", from = { "CC(=O)CCC(=O)c1ccc(Br)cc1" } },
    example { "Cc1ccc(C)s1", from = { "CC(=O)CCC(C)=O" } },
    refuse { "c1ccc2sccc2c1" }, -- a benzothiophene
}

disconnection "clauson-kaas" {
    about = "Clauson-Kaas pyrrole synthesis; N-substituted pyrrole without C substituents",
    rxno = "RXNO:0000312",
    target = "[nX3;+0:1]1(-[#6:6]):[cH1:2]:[cH1:3]:[cH1:4]:[cH1:5]:1",
    from = "[N:1]-[#6:6].CO[C:2]1-[C:3]-[C:4]-[C:5](OC)O1",
    conditions = "acid-hot-dry",
    also_attacks = { "other primary amine" },
    recipe = "AcOH, reflux, or P2O5, toluene",
    yield = { 60, 90 },
    source = "Joule, Mills, Heterocyclic Chemistry; from memory",
    example { "COC(=O)c1ccc(-n2cccc2)cc1", from = { "COC(=O)c1ccc(N)cc1", "COC1CCC(OC)O1" } },
    example { "c1ccc(-n2cccc2)cc1", from = { "Nc1ccccc1", "COC1CCC(OC)O1" } },
    refuse { "Cc1ccc(C)n1-c1ccccc1" }, -- substituted pyrrole carbons: Paal-Knorr
}

disconnection "knorr-pyrrole" {
    about = "Knorr pyrrole synthesis; the amino ketone is made in situ from the oxime",
    rxno = "RXNO:0000497",
    target = "[nH1:1]1:[c;$(c-[CX3]=O):2]:[c;$(c-[#6]):3]:[c;$(c-[CX3]=O):4]:[c;$(c-[#6]):5]:1",
    from = "[N:1]-[C:2]-[C:3]=O.[C:4]-[C:5]=O",
    conditions = "zn-acid",
    also_attacks = { "aldehyde", "other ketone" },
    recipe = "oximino ester, Zn, AcOH, 60-100 °C",
    yield = { 50, 80 },
    source = "Joule, Mills, Heterocyclic Chemistry; from memory",
    example { "CCOC(=O)c1[nH]c(C)c(C(=O)OCC)c1C", from = { "CCOC(=O)C(N)C(C)=O", "CCOC(=O)CC(C)=O" } },
    example { "CCOC(=O)c1[nH]c(C)c(C(C)=O)c1C", from = { "CCOC(=O)C(N)C(C)=O", "CC(=O)CC(C)=O" } },
    refuse { "Cc1ccc(C)[nH]1" }, -- no acyl groups: Paal-Knorr
}

interconversion "dihydropyridine-oxidation" {
    about = "Oxidation of a Hantzsch dihydropyridine; 4-benzyl and 4-sec-alkyl groups may be lost",
    target = "[nX2;+0:1]1:[c;R1:2]:[c;R1;$(c-[$([CX3]=O),$(C#N)]):3]:[c;R1:4]:[c;R1;$(c-[$([CX3]=O),$(C#N)]):5]:[c;R1:6]:1",
    from = "[NH:1]1-[C:2]=[C:3]-[C:4]-[C:5]=[C:6]-1",
    conditions = "ddq",
    also_attacks = { "phenol", "sulfide", "primary amine", "other dihydropyridine" },
    recipe = "HNO3 dil., or CAN, DDQ, MnO2, CH2Cl2, rt",
    yield = { 75, 95 },
    cautions = { "nitric acid", "DDQ" },
    source = "Joule, Mills, Heterocyclic Chemistry; from memory",
    example { "CCOC(=O)c1cc(C(=O)OCC)c(C)nc1C", from = { "CCOC(=O)C1=C(C)NC(C)=C(C(=O)OCC)C1" } },
    example { "COC(=O)c1c(C)nc(C)c(C(=O)OC)c1-c1ccccc1[N+](=O)[O-]",
        from = { "COC(=O)C1=C(C)NC(C)=C(C(=O)OC)C1c1ccccc1[N+](=O)[O-]" } },
    refuse { "c1ccncc1" }, -- no acceptors at C3 and C5: the dihydropyridine is not stable
}

disconnection "larock-indole" {
    about = "Larock indole synthesis; the bulkier end of the alkyne comes next to nitrogen",
    rxno = "RXNO:0000396",
    target = "[nX3;+0:1]1:[c;$(c1ccccc1):2]:[c;$(c1ccccc1):3]:[c;R1;$(c-[#6]):4]:[c;R1;$(c-[#6,Si]):5]:1",
    from = "[N:1]-[c:2]:[c:3]I.[C:4]#[C:5]",
    conditions = "pd0",
    recipe = "Pd(OAc)2, LiCl, K2CO3, DMF, 100 °C",
    yield = { 60, 90 },
    source = "Larock, Yum, J. Am. Chem. Soc. 1991, 113, 6689; from memory",
    example { "CCc1c([Si](C)(C)C)[nH]c2ccc(OC)cc12", from = { "COc1ccc(N)c(I)c1", "CCC#C[Si](C)(C)C" } },
    example { "Cc1c(-c2ccccc2)[nH]c2ccccc12", from = { "Nc1ccccc1I", "CC#Cc1ccccc1" } },
    refuse { "Cc1cc2ccccc2[nH]1" }, -- C3 unsubstituted: the alkyne would be terminal
}

disconnection "bartoli-indole" {
    about = "Bartoli indole synthesis; 7-substituted indoles",
    rxno = "RXNO:0000494",
    target = "[nH1;+0:1]1:[c;$(c1ccccc1);$(c:c-[CX4,F,Cl,Br,I,OX2,c]):2]:[c;$(c1ccccc1):3]:[cH1:4]:[c:5]:1",
    from = "[O-][N+:1](=O)-[c:2]:[cH:3].Br[Mg][C:5]=[C:4]",
    conditions = "grignard",
    also_attacks = { "nitrile" },
    recipe = "vinylMgBr (3 equiv.), THF, -40 °C",
    yield = { 40, 70 },
    cautions = { "magnesium vinyl halide" },
    source = "Bartoli et al., Tetrahedron Lett. 1989, 30, 2129; from memory",
    example { "Brc1cccc2cc[nH]c12", from = { "O=[N+]([O-])c1ccccc1Br", "C=C[Mg]Br" } },
    example { "Cc1cccc2cc[nH]c12", from = { "O=[N+]([O-])c1ccccc1C", "C=C[Mg]Br" } },
    refuse { "COc1ccc2[nH]ccc2c1" }, -- no group at C7: the nitroarene needs an ortho substituent
}

disconnection "madelung-indole" {
    about = "Madelung indole synthesis; 2-substituted",
    rxno = "RXNO:0000511",
    target = "[nH1;+0:1]1:[c;$(c1ccccc1):2]:[c;$(c1ccccc1):3]:[cH1:4]:[c;$(c-[CX4,c]):5]:1",
    from = "[N:1](-[C:5]=O)-[c:2]:[c:3]-[C:4]",
    conditions = "organolithium",
    also_attacks = { "amide", "epoxide" },
    recipe = "BuLi (3 equiv.), THF, rt (Houlihan); NaNH2 or KOtBu, 250-350 °C",
    yield = { 55, 85 },
    cautions = { "butyllithium", "sodium amide" },
    source = "Joule, Mills, Heterocyclic Chemistry; from memory",
    example { "c1ccc(-c2cc3ccccc3[nH]2)cc1", from = { "Cc1ccccc1NC(=O)c1ccccc1" } },
    example { "Cc1cc2ccccc2[nH]1", from = { "CC(=O)Nc1ccccc1C" } },
    refuse { "O=[N+]([O-])c1ccc2[nH]ccc2c1" }, -- formamide of the parent and a base-sensitive nitro group
}

disconnection "leimgruber-batcho" {
    about = "Leimgruber-Batcho indole synthesis; 2,3-unsubstituted",
    rxno = "RXNO:0000672",
    target = "[nH1;+0:1]1:[c;$(c1ccccc1):2]:[c;$(c1ccccc1):3]:[cH1:4]:[cH1:5]:1",
    from = "[O-][N+:1](=O)-[c:2]:[c:3]-[C:4].CO[C:5](OC)N(C)C",
    conditions = "h2-pd",
    also_attacks = { "primary amine", "other acidic CH" },
    recipe = "DMF-DMA, pyrrolidine, DMF, 110 °C; then H2, Pd/C or Fe, AcOH",
    yield = { 60, 85 },
    cautions = { "hydrogen" },
    source = "Joule, Mills, Heterocyclic Chemistry; from memory",
    example { "COC(=O)c1ccc2cc[nH]c2c1", from = { "COC(=O)c1ccc(C)c([N+](=O)[O-])c1", "COC(OC)N(C)C" } },
    example { "c1ccc(COc2cccc3[nH]ccc23)cc1", from = { "Cc1c(OCc2ccccc2)cccc1[N+](=O)[O-]", "COC(OC)N(C)C" } },
    refuse { "Cc1cc2ccccc2[nH]1" }, -- C2 or C3 substituted
}

disconnection "skraup" {
    about = "Skraup quinoline synthesis; pyridine ring unsubstituted; meta-substituted anilines give 5 and 7",
    rxno = "RXNO:0000062",
    target = "[nX2:1]1:[c;$(c1ccccc1):2]:[c;$(c1ccccc1):3]:[cH1:4]:[cH1:5]:[cH1:6]:1",
    from = "[N:1]-[c:2]:[cH:3].O[C:4]-[C:5](O)-[C:6]O",
    conditions = "acid-aq-strong",
    also_attacks = { "free alcohol", "alkene" },
    recipe = "H2SO4, glycerol, As2O5 or nitroarene or NaI, 130-150 °C",
    yield = { 40, 80 },
    cautions = { "sulfuric acid" },
    source = "Joule, Mills, Heterocyclic Chemistry; from memory",
    example { "COc1cc([N+](=O)[O-])c2ncccc2c1", from = { "COc1ccc(N)c([N+](=O)[O-])c1", "OCC(O)CO" } },
    example { "c1ccc2ncccc2c1", from = { "Nc1ccccc1", "OCC(O)CO" } },
    refuse { "Cc1ccc2ccccc2n1" }, -- substituted in the pyridine ring: Doebner-Miller
}

disconnection "doebner-miller" {
    about = "Doebner-Miller quinoline synthesis; 2-substituted from enals, 2,4 from enones",
    rxno = "RXNO:0000159",
    target = "[nX2:1]1:[c;$(c1ccccc1):2]:[c;$(c1ccccc1):3]:[c:4]:[cH1:5]:[c;$(c-[#6]):6]:1",
    from = "[N:1]-[c:2]:[cH:3].O=[C:4]-[C:5]=[C:6]",
    conditions = "acid-aq-strong",
    also_attacks = { "thiol" },
    recipe = "6 M HCl, toluene, 100 °C, or ZnCl2",
    yield = { 40, 75 },
    cautions = { "crotonaldehyde" },
    source = "Joule, Mills, Heterocyclic Chemistry; from memory",
    example { "Cc1ccc2cc(Cl)ccc2n1", from = { "Nc1ccc(Cl)cc1", "CC=CC=O" } },
    example { "Cc1ccc2ccccc2n1", from = { "Nc1ccccc1", "CC=CC=O" } },
    refuse { "c1ccc2ncccc2c1" }, -- C2 unsubstituted: Skraup
}

disconnection "friedlaender" {
    about = "Friedländer quinoline synthesis; more acidic α carbon in base, more substituted in acid",
    rxno = "RXNO:0000577",
    target = "[nX2:1]1:[c;$(c1ccccc1):2]:[c;$(c1ccccc1):3]:[c;$(c-[#6]),H1:4]:[c:5]:[c;$(c-[#6]):6]:1",
    from = "[N:1]-[c:2]:[c:3]-[C:4]=O.[C:5]-[C:6]=O",
    conditions = "base-aq-strong",
    also_attacks = { "other ketone" },
    recipe = "KOH, EtOH, reflux, or TsOH, AcOH, 100 °C",
    yield = { 60, 95 },
    source = "Joule, Mills, Heterocyclic Chemistry; from memory",
    example { "CCOC(=O)c1c(C)nc2ccc(Cl)cc2c1-c1ccccc1", from = { "Nc1ccc(Cl)cc1C(=O)c1ccccc1", "CCOC(=O)CC(C)=O" } },
    example { "Cc1ccc2ccccc2n1", from = { "Nc1ccccc1C=O", "CC(C)=O" } },
    refuse { "c1ccc2ncccc2c1" }, -- acetaldehyde condenses with itself
}

disconnection "combes" {
    about = "Combes quinoline synthesis; 2,4-disubstituted; unsymmetrical diketones give two products",
    rxno = "RXNO:0000642",
    target = "[nX2:1]1:[c;$(c1ccccc1):2]:[c;$(c1ccccc1):3]:[c;$(c-[#6]):4]:[c;R1;$(c-[#6]),H1:5]:[c;$(c-[#6]);R1:6]:1",
    from = "[N:1]-[c:2]:[cH:3].O=[C:4]-[C:5]-[C:6]=O",
    conditions = "acid-aq-strong",
    also_attacks = { "free alcohol" },
    recipe = "neat, then conc. H2SO4 or PPA, 100 °C",
    yield = { 55, 85 },
    cautions = { "sulfuric acid", "polyphosphoric acid" },
    source = "Joule, Mills, Heterocyclic Chemistry; from memory",
    example { "COc1ccc2nc(C)cc(C)c2c1", from = { "COc1ccc(N)cc1", "CC(=O)CC(C)=O" } },
    example { "Cc1cc(C)c2ccccc2n1", from = { "Nc1ccccc1", "CC(=O)CC(C)=O" } },
    refuse { "Cc1ccc2ccccc2n1" }, -- C4 unsubstituted: Doebner-Miller
}

disconnection "gould-jacobs" {
    about = "Gould-Jacobs quinolone synthesis; meta-substituted anilines close at the less hindered carbon",
    target = "[nH1:1]1:[c;$(c1ccccc1):2]:[c;$(c1ccccc1):3]:[c:4](=[OX1:7]):[c;$(c-C(=O)[OX2]):5]:[cH1:6]:1",
    from = "[N:1]-[c:2]:[cH:3].CCO[C:6]=[C:5]-[C:4](=[O:7])OCC",
    conditions = "heat-200",
    also_attacks = { "other primary amine", "acid-labile acetal", "tert-butyl ester" },
    recipe = "neat, 120 °C; then Ph2O, 250 °C",
    yield = { 60, 90 },
    cautions = { "diphenyl ether at 250 °C" },
    source = "Joule, Mills, Heterocyclic Chemistry; from memory",
    example { "CCOC(=O)c1c[nH]c2cc(Cl)c(F)cc2c1=O", from = { "Nc1ccc(F)c(Cl)c1", "CCOC=C(C(=O)OCC)C(=O)OCC" } },
    example { "CCOC(=O)c1c[nH]c2ccccc2c1=O", from = { "Nc1ccccc1", "CCOC=C(C(=O)OCC)C(=O)OCC" } },
    refuse { "O=c1cc[nH]c2ccccc12" }, -- no ester at C3
}

disconnection "quinoxaline" {
    about = "Quinoxaline from a 1,2-diamine and a 1,2-diketone; unsymmetrical partners give two isomers",
    target = "[nX2:1]1:[c;$(c1aaaaa1):2]:[c;$(c1aaaaa1):3]:[nX2:4]:[c:5]:[c:6]:1",
    from = "[N:1]-[c:2]:[c:3]-[N:4].O=[C:5]-[C:6]=O",
    conditions = "acid-aq-mild",
    also_attacks = { "other aldehyde", "other ketone" },
    recipe = "EtOH or AcOH, rt to reflux",
    yield = { 75, 98 },
    source = "Joule, Mills, Heterocyclic Chemistry; from memory",
    example { "Cc1nc2ccc(C(=O)O)cc2nc1C", from = { "Nc1ccc(C(=O)O)cc1N", "CC(=O)C(C)=O" } },
    example { "c1ccc(cc1)-c1nc2ccccc2nc1-c1ccccc1", from = { "Nc1ccccc1N", "O=C(C(=O)c1ccccc1)c1ccccc1" } },
    refuse { "c1ccc2ncncc2c1" }, -- a quinazoline
}

disconnection "biginelli" {
    about = "Biginelli reaction; racemic",
    rxno = "RXNO:0000236",
    target = "[NX3;H1:1]1-[CX4;H1:2]-[CX3;$(C-[CX3]=O):3]=[CX3:4]-[NX3;H1:5]-[CX3:6](=[OX1,SX1:7])-1",
    from = "[N:1]-[C:6](=[*:7])-[N:5].O=[C:2].[C:3]-[C:4]=O",
    conditions = "acid-hot-dry",
    also_attacks = { "other primary amine" },
    recipe = "HCl cat., EtOH, reflux; or Yb(OTf)3, Lewis acids",
    yield = { 60, 95 },
    source = "Kürti, Czakó, Strategic Applications of Named Reactions in Organic Synthesis; from memory",
    example { "CCOC(=O)C1=C(C)NC(=S)NC1c1cccc(O)c1", from = { "NC(N)=S", "O=Cc1cccc(O)c1", "CCOC(=O)CC(C)=O" } },
    example { "CCOC(=O)C1=C(C)NC(=O)NC1c1ccccc1", from = { "NC(N)=O", "O=Cc1ccccc1", "CCOC(=O)CC(C)=O" } },
    refuse { "O=C1NCC=CN1" }, -- no acyl group at C5
}

disconnection "debus-radziszewski" {
    about = "Debus-Radziszewski imidazole synthesis; 2,4,5-trisubstituted",
    rxno = "RXNO:0000613",
    target = "[nX2:1]1:[c;R1;$(c-[#6]),H1:2]:[c;R1;$(c-[#6]),H1:3]:[nX3;H1:4]:[c;$(c-[#6]):5]:1",
    from = "[N:1].O=[C:2]-[C:3]=O.[N:4].O=[C:5]",
    conditions = "acid-hot-dry",
    recipe = "NH4OAc, AcOH, reflux",
    yield = { 65, 95 },
    source = "Joule, Mills, Heterocyclic Chemistry; from memory",
    example { "COc1ccc(-c2nc(-c3ccccc3)c(-c3ccccc3)[nH]2)cc1",
        from = { "N", "O=C(c1ccccc1)C(=O)c1ccccc1", "N", "COc1ccc(C=O)cc1" } },
    example { "c1ccc(cc1)-c1nc(c([nH]1)-c1ccccc1)-c1ccccc1",
        from = { "N", "O=C(C(=O)c1ccccc1)c1ccccc1", "N", "O=Cc1ccccc1" } },
    example { "Cc1ncc[nH]1", from = { "N", "O=CC=O", "N", "CC=O" } },
    refuse { "c1ccc2[nH]cnc2c1" }, -- a benzimidazole
}

disconnection "phillips-benzimidazole" {
    about = "Phillips benzimidazole synthesis; one substituted nitrogen fixes the position",
    rxno = "RXNO:0000399",
    target = "[nX2:1]1:[c;$(c1aaaaa1):2]:[c;$(c1aaaaa1):3]:[nX3:4]:[c;R1;$(c-[#6]),H1:5]:1",
    from = "[N:1]-[c:2]:[c:3]-[N:4].O[C:5]=O",
    conditions = "acid-aq-strong",
    also_attacks = { "free alcohol", "other primary amine" },
    recipe = "4 M HCl or PPA or EDC then AcOH, reflux; also: orthoester, aldehyde with an oxidant",
    yield = { 65, 95 },
    cautions = { "polyphosphoric acid" },
    source = "Joule, Mills, Heterocyclic Chemistry; from memory",
    example { "CCCc1nc2c(C)cc(C(=O)OC)cc2[nH]1", from = { "COC(=O)c1cc(C)c(N)c(N)c1", "CCCC(=O)O" } },
    example { "c1ccc2[nH]cnc2c1", from = { "Nc1ccccc1N", "OC=O" } },
    refuse { "c1ccc2[nH]ncc2c1" }, -- an indazole
}

disconnection "robinson-gabriel" {
    about = "Robinson-Gabriel oxazole synthesis; 2,5-disubstituted; the amide oxygen stays",
    target = "[o:1]1:[c;R1;$(c-[#6]):2]:[nX2:3]:[c;R1:4]:[c;R1;$(c-[#6]):5]:1",
    from = "[O:1]=[C:2]-[N:3]-[C:4]-[C:5]=O",
    conditions = "socl2",
    recipe = "POCl3, or H2SO4/Ac2O, or PPh3, I2, Et3N",
    yield = { 60, 85 },
    cautions = { "phosphoryl chloride" },
    source = "Joule, Mills, Heterocyclic Chemistry; from memory",
    example { "COC(=O)Cc1nc(-c2ccccc2)oc1C", from = { "COC(=O)CC(NC(=O)c1ccccc1)C(C)=O" } },
    example { "c1ccc(cc1)-c1cnc(o1)-c1ccccc1", from = { "O=C(CNC(=O)c1ccccc1)c1ccccc1" } },
    refuse { "c1ccc2ocnc2c1" }, -- a benzoxazole
}

disconnection "van-leusen-oxazole" {
    about = "Van Leusen oxazole synthesis; 5-substituted",
    target = "[o;+0:1]1:[cH1;+0:2]:[nX2;+0:3]:[cH1:4]:[c;R1;$(c-[#6]):5]:1",
    from = "[O:1]=[C:5].[C-:2]#[N+:3]-[C:4]S(=O)(=O)c1ccc(C)cc1",
    conditions = "base-aq-mild",
    also_attacks = { "other aldehyde", "alkyl halide", "enone" },
    recipe = "TosMIC, K2CO3, MeOH, reflux",
    yield = { 65, 95 },
    cautions = { "tosylmethyl isocyanide" },
    source = "Joule, Mills, Heterocyclic Chemistry; from memory",
    example { "COc1cc(-c2cnco2)ccc1[N+](=O)[O-]",
        from = { "COc1cc(C=O)ccc1[N+](=O)[O-]", "[C-]#[N+]CS(=O)(=O)c1ccc(C)cc1" } },
    example { "c1ccc(cc1)-c1cnco1", from = { "O=Cc1ccccc1", "[C-]#[N+]CS(=O)(=O)c1ccc(C)cc1" } },
    refuse { "Cc1nc(C)co1" }, -- C2 substituted
}

disconnection "isoxazole-claisen" {
    about = "Isoxazole from a 1,3-diketone and hydroxylamine; two isomers with unsymmetrical diketones",
    target = "[o:1]1:[nX2:2]:[c;R1;$(c-[#6]):3]:[c;R1:4]:[c;R1;$(c-[#6]):5]:1",
    from = "[O:1]-[N:2].O=[C:3]-[C:4]-[C:5]=O",
    conditions = "acid-aq-mild",
    also_attacks = { "aldehyde", "other ketone", "alkyl halide" },
    recipe = "NH2OH·HCl, EtOH, reflux",
    yield = { 65, 90 },
    cautions = { "hydroxylamine hydrochloride" },
    source = "Joule, Mills, Heterocyclic Chemistry; from memory",
    example { "COc1ccc(-c2cc(C)no2)cc1", from = { "NO", "COc1ccc(C(=O)CC(C)=O)cc1" } },
    example { "Cc1cc(C)on1", from = { "NO", "CC(=O)CC(C)=O" } },
    refuse { "c1ccc2oncc2c1" }, -- a benzisoxazole
}

disconnection "oxadiazole-124" {
    about = "1,2,4-Oxadiazole from an amidoxime and an acid; acid carbon becomes C5, amidoxime carbon C3",
    target = "[o:1]1:[nX2:2]:[c;$(c-[#6]):3]:[nX2:4]:[c;$(c-[#6]):5]:1",
    from = "[O:1]-[N:2]=[C:3]-[N:4].O[C:5]=O",
    conditions = "acylation",
    recipe = "CDI or EDC/HOBt, DMF, then 100 °C; T3P; also: acid chloride, ester with NaH",
    yield = { 60, 90 },
    source = "Joule, Mills, Heterocyclic Chemistry; from memory",
    example { "Cc1noc(-c2ccc(Br)cc2)n1", from = { "CC(N)=NO", "O=C(O)c1ccc(Br)cc1" } },
    example { "c1ccc(cc1)-c1noc(n1)-c1ccccc1", from = { "NC(=NO)c1ccccc1", "OC(=O)c1ccccc1" } },
    refuse { "Cc1nnc(C)o1" }, -- the 1,3,4-isomer
}

disconnection "oxadiazole-134" {
    about = "1,3,4-Oxadiazole from a diacylhydrazine; symmetrical in the ring",
    target = "[o:1]1:[c;$(c-[#6]):2]:[nX2:3]:[nX2:4]:[c;$(c-[#6]):5]:1",
    from = "[O:1]=[C:2]-[N:3]-[N:4]-[C:5]=O",
    conditions = "socl2",
    recipe = "POCl3, reflux, or Burgess reagent, THF; PPh3, CCl4",
    yield = { 65, 90 },
    cautions = { "phosphoryl chloride" },
    source = "Joule, Mills, Heterocyclic Chemistry; from memory",
    example { "Cc1nnc(-c2ccc(F)cc2)o1", from = { "CC(=O)NNC(=O)c1ccc(F)cc1" } },
    example { "c1ccc(cc1)-c1nnc(o1)-c1ccccc1", from = { "O=C(NNC(=O)c1ccccc1)c1ccccc1" } },
    refuse { "Cc1noc(C)n1" }, -- the 1,2,4-isomer
}

disconnection "thiadiazole-134" {
    about = "1,3,4-Thiadiazole from a diacylhydrazine; sulfur from the reagent",
    target = "s1:[c;$(c-[#6]):2]:[nX2:3]:[nX2:4]:[c;$(c-[#6]):5]:1",
    from = "O=[C:2]-[N:3]-[N:4]-[C:5]=O",
    conditions = "heat-200",
    also_attacks = { "free alcohol", "other amide", "ketone" },
    recipe = "Lawesson's reagent, toluene or THF, 70-110 °C",
    yield = { 65, 90 },
    cautions = { "Lawesson's reagent (stench)" },
    source = "Joule, Mills, Heterocyclic Chemistry; from memory",
    example { "Cc1nnc(-c2ccc(Cl)cc2)s1", from = { "CC(=O)NNC(=O)c1ccc(Cl)cc1" } },
    example { "Cc1nnc(C)s1", from = { "CC(=O)NNC(C)=O" } },
    refuse { "Cc1nsc(C)n1" }, -- the 1,2,4-isomer
}

disconnection "aminothiadiazole" {
    about = "2-Amino-1,3,4-thiadiazole from a thiosemicarbazide and an acid; ring closes through sulfur in acid, through nitrogen (triazolethione) in base",
    target = "[s:1]1:[c:2](-[NX3;H1,H2:6]):[nX2:3]:[nX2:4]:[c;$(c-[#6]):5]:1",
    from = "[S:1]=[C:2](-[N:6])-[N:3]-[N:4].O[C:5]=O",
    conditions = "socl2",
    recipe = "POCl3 or conc. H2SO4 or PPA, 80-100 °C",
    yield = { 60, 90 },
    cautions = { "phosphoryl chloride" },
    source = "Joule, Mills, Heterocyclic Chemistry; from memory",
    example { "Nc1nnc(C(F)(F)F)s1", from = { "NNC(N)=S", "O=C(O)C(F)(F)F" } },
    example { "Cc1nnc(N)s1", from = { "NNC(N)=S", "CC(=O)O" } },
    refuse { "Cc1nnc(C)s1" }, -- no amino group
}

disconnection "tetrazole" {
    about = "5-Substituted tetrazole from a nitrile; 1H/2H tautomers",
    rxno = "RXNO:0000370",
    target = "[c:1]1(-[#6:2]):[n;D2;+0:3]:[n;D2;+0:4]:[n;D2;+0:5]:[n;D2;+0:6]:1",
    from = "[C:1](-[#6:2])#[N:3].[Na+].[N-:4]=[N+:5]=[N-:6]",
    conditions = "alkylation",
    also_attacks = { "alkyl halide", "epoxide" },
    spares = { "nitrile" },
    recipe = "NaN3, ZnBr2, H2O, reflux; NaN3, Et3N·HCl, toluene, 100 °C; Bu3SnN3",
    yield = { 70, 95 },
    cautions = { "sodium azide", "hydrazoic acid" },
    source = "Demko, Sharpless, J. Org. Chem. 2001, 66, 7945; from memory",
    example { "Cc1ccc(-c2ccccc2-c2nnn[nH]2)cc1", from = { "Cc1ccc(-c2ccccc2C#N)cc1", "[Na+].[N-]=[N+]=[N-]" } },
    example { "c1ccc(cc1)-c1nnn[nH]1", from = { "N#Cc1ccccc1", "[Na+].[N-]=[N+]=[N-]" } },
    refuse { "Cn1nnnc1-c1ccccc1" }, -- N-substituted: alkylation or imidoyl azide
}

disconnection "triazole-124" {
    about = "1,2,4-Triazole from a hydrazide and an amidine; NH tautomers",
    target = "[nX3;H1;+0:1]1:[nX2:2]:[c;$(c-[#6]):3]:[nX2:4]:[c;$(c-[#6]):5]:1",
    from = "[N:1]-[N:2]-[C:3]=O.[N:4]-[C:5]=N",
    conditions = "alkoxide",
    recipe = "NaOMe or K2CO3, BuOH, 120-150 °C; also: nitrile (K2CO3), amide (Pellizzari)",
    yield = { 55, 85 },
    source = "Joule, Mills, Heterocyclic Chemistry; from memory",
    example { "c1ccc(-c2n[nH]c(-c3ccncc3)n2)cc1", from = { "NNC(=O)c1ccccc1", "NC(=N)c1ccncc1" } },
    example { "c1ccc(cc1)-c1n[nH]c(n1)-c1ccccc1", from = { "NNC(=O)c1ccccc1", "N=C(N)c1ccccc1" } },
    refuse { "c1cnn[nH]1" }, -- the 1,2,3-isomer
}

disconnection "pyrimidine-amidine" {
    about = "Pyrimidine from an amidine and a 1,3-diketone (Pinner); 4,6 exchange with unsymmetrical diketones does not matter for symmetric amidines",
    rxno = "RXNO:0000402",
    target = "[nX2:1]1:[c;$(c-[#6,#7]):2]:[nX2:3]:[c;R1;$(c-[#6]):4]:[c;R1:5]:[c;R1;$(c-[#6]),H1:6]:1",
    from = "[N:1]=[C:2]-[N:3].O=[C:4]-[C:5]-[C:6]=O",
    conditions = "alkoxide",
    recipe = "NaOEt or K2CO3, EtOH, reflux; also: guanidine, thiourea, enaminone",
    yield = { 60, 90 },
    source = "Joule, Mills, Heterocyclic Chemistry; from memory",
    example { "Cc1cc(C)nc(-c2ccc(Cl)cc2)n1", from = { "N=C(N)c1ccc(Cl)cc1", "CC(=O)CC(C)=O" } },
    example { "Cc1cc(C)nc(N)n1", from = { "N=C(N)N", "CC(=O)CC(C)=O" } },
    refuse { "c1ccc2ncncc2c1" }, -- a quinazoline
}

disconnection "pyrimidinone" {
    about = "Pyrimidin-4-one from an amidine and a β-keto ester; ester carbon becomes C4=O",
    rxno = "RXNO:0000400",
    target = "[nX3;H1:1]1:[c;$(c-[#6,#7]):2]:[nX2:3]:[c;R1;$(c-[#6]):4]:[c;R1:5]:[c;R1:6]:1=[OX1:7]",
    from = "[N:1]=[C:2]-[N:3].O=[C:4]-[C:5]-[C:6](=[O:7])OCC",
    conditions = "alkoxide",
    recipe = "NaOEt, EtOH, reflux; K2CO3, H2O",
    yield = { 65, 90 },
    cautions = { "sodium ethoxide" },
    source = "Joule, Mills, Heterocyclic Chemistry; from memory",
    example { "Cc1cc(=O)[nH]c(-c2ccccc2)n1", from = { "N=C(N)c1ccccc1", "CCOC(=O)CC(C)=O" } },
    example { "Cc1cc(=O)[nH]c(N)n1", from = { "N=C(N)N", "CCOC(=O)CC(C)=O" } },
    refuse { "O=c1[nH]cnc2ccccc12" }, -- a quinazolinone
}

disconnection "barbiturate" {
    about = "Barbiturate from a malonate and urea; 5,5-dialkyl groups are put in before",
    target = "[NX3;H1:1]1-[CX3:2](=[OX1,SX1:3])-[NX3;H1:4]-[CX3:5](=[OX1:6])-[CX4:7]-[CX3:8](=[OX1:9])-1",
    from = "[N:1]-[C:2](=[*:3])-[N:4].CCO[C:5](=[O:6])-[C:7]-[C:8](=[O:9])OCC",
    conditions = "alkoxide",
    recipe = "NaOEt, EtOH, reflux",
    yield = { 55, 80 },
    cautions = { "sodium ethoxide" },
    source = "Vogel's Textbook of Practical Organic Chemistry; from memory",
    example { "CCC1(CCC(C)C)C(=O)NC(=O)NC1=O", from = { "NC(N)=O", "CCOC(=O)C(CC)(CCC(C)C)C(=O)OCC" } },
    example { "CCC1(CC)C(=O)NC(=O)NC1=O", from = { "NC(N)=O", "CCOC(=O)C(CC)(CC)C(=O)OCC" } },
    refuse { "O=C1CCNC(=O)N1" }, -- a dihydrouracil
}

disconnection "bucherer-bergs" {
    about = "Bucherer-Bergs hydantoin synthesis; equatorial C=O (anti to the Strecker product) in cyclohexanones",
    target = "[NX3;H1:1]1-[CX3:2](=[OX1:3])-[NX3;H1;+0:4]-[CX3;+0:5](=O)-[CX4:6]-1",
    from = "O=[C:6].[Na+].[C-:5]#[N:4].[N:1].[C:2](=[O:3])=O",
    conditions = "cyanide",
    also_attacks = { "other aldehyde", "alkyl halide", "acyl halide" },
    recipe = "NaCN, (NH4)2CO3, aq. EtOH, 60 °C",
    yield = { 60, 90 },
    cautions = { "sodium cyanide" },
    source = "Vogel's Textbook of Practical Organic Chemistry; from memory",
    example { "O=C1NC(=O)C2(CCN(Cc3ccccc3)CC2)N1",
        from = { "O=C1CCN(Cc2ccccc2)CC1", "[Na+].[C-]#N", "N", "O=C=O" } },
    example { "CC1(C)NC(=O)NC1=O", from = { "CC(C)=O", "[Na+].[C-]#N", "N", "O=C=O" } },
    refuse { "O=C1CNC(=O)CN1" }, -- a diketopiperazine
}

disconnection "quinazolinone" {
    about = "Niementowski quinazolinone synthesis; 3H-quinazolin-4-one",
    rxno = "RXNO:0000583",
    target = "[nX3;H1:1]1:[c;R1:2]:[nX2:3]:[c;R2;$(c1ccccc1):4]:[c;R2:5]:[c:6]:1=[OX1:7]",
    from = "[N:1]-[C:2]=O.[N:3]-[c:4]:[c:5]-[C:6](=[O:7])O",
    conditions = "heat-200",
    also_attacks = { "other free acid", "other ester", "other primary amine" },
    recipe = "formamide, 130-150 °C; or formamidine acetate, EtOH, reflux",
    yield = { 65, 95 },
    cautions = { "formamide" },
    source = "Joule, Mills, Heterocyclic Chemistry; from memory",
    example { "COc1cc2nc[nH]c(=O)c2cc1OC", from = { "NC=O", "COc1cc(N)c(C(=O)O)cc1OC" } },
    example { "O=c1[nH]cnc2ccccc12", from = { "NC=O", "Nc1ccccc1C(=O)O" } },
    refuse { "O=c1[nH]c(=O)c2ccccc2[nH]1" }, -- a quinazolinedione: urea or isocyanate
}

disconnection "lactam-closure" {
    about = "Lactam from an amino ester; five- and six-membered rings spontaneously",
    target = "[NX3;r5,r6;+0;!$(N(-[CX3]=O)-[CX3,SX4]=O);!$(N-[N,O,S]);!$(N-c);!$(N-[CX3]=[CX3]);!$(N-[CX4][#7,#8,#16]):1]-;@[CX3;r5,r6:2](=[OX1:3])-;@[CX4,c:4]",
    from = "([N:1].CCO[C:2](=[O:3])-[#6:4])",
    conditions = "alkoxide",
    recipe = "toluene or EtOH, reflux, or NaOEt; seven-membered rings with HATU from the acid; also: OMe",
    yield = { 75, 98 },
    source = "Clayden, Greeves, Warren, Organic Chemistry; from memory",
    example { "O=C1CCC(c2ccc(F)cc2)N1", from = { "CCOC(=O)CCC(N)c1ccc(F)cc1" } },
    example { "O=C1CCCN1", from = { "CCOC(=O)CCCN" } },
    refuse { "O=C1CCN1" }, -- a β-lactam does not close from an ester
    refuse { "O=C1c2ccccc2C(=O)N1C" }, -- an imide
    refuse { "O=C1CNC(=O)N1" }, -- a hydantoin
}

disconnection "lactone-closure" {
    about = "Lactonisation of a hydroxy acid; retention at the carbinol carbon",
    target = "[OX2;r5,r6;$(O(-[CX4;!$(C(O)[#7,#8,#16])])-[CX3]):1]-;@[CX3;r5,r6:2](=[OX1:3])-;@[CX4,c:4]",
    from = "([O:1].O[C:2](=[O:3])-[#6:4])",
    conditions = "acid-hot-dry",
    also_attacks = { "other free alcohol", "primary amine" },
    recipe = "TsOH cat., toluene, Dean-Stark, or spontaneous in acid",
    yield = { 80, 98 },
    source = "Clayden, Greeves, Warren, Organic Chemistry; from memory",
    example { "O=C1CCC(CCc2ccccc2)O1", from = { "O=C(O)CCC(O)CCc1ccccc1" } },
    example { "O=C1CCCO1", from = { "OCCCC(=O)O" } },
    refuse { "O=C1OCCO1" }, -- a carbonate
}

disconnection "macrolactonisation" {
    about = "Yamaguchi macrolactonisation; retention at the carbinol carbon; dimers are the rival",
    rxno = "RXNO:0000308",
    target = "[OX2;R;$(O-[CX4]);!r3;!r4;!r5;!r6;!r7;!r8:1]-;@[CX3;R;!r3;!r4;!r5;!r6;!r7;!r8:2](=[OX1:3])-;@[CX4,CX3:4]",
    from = "([O:1].O[C:2](=[O:3])-[C:4])",
    conditions = "acylation",
    recipe = "2,4,6-Cl3C6H2COCl, Et3N, then DMAP, toluene, reflux, slow addition (1-5 mM)",
    yield = { 50, 85 },
    cautions = { "2,4,6-trichlorobenzoyl chloride" },
    source = "Carey, Sundberg, Advanced Organic Chemistry Part B; from memory",
    example { "CC1CCCCCCCCCC(=O)O1", from = { "CC(O)CCCCCCCCCC(=O)O" } },
    example { "O=C1CCCCCCCCCCCCCCO1", from = { "OCCCCCCCCCCCCCCC(=O)O" } },
    refuse { "O=C1CCCCCO1" }, -- a seven-membered lactone
}

disconnection "wenker-aziridine" {
    about = "Wenker aziridine synthesis; inversion at the carbinol carbon",
    rxno = "RXNO:0000590",
    target = "[NX3;r3;!$(N-[CX3]=O);R1:1]1-[CX4;r3;R1:2]-[CX4;r3;R1:3]-1",
    from = "[N:1]-[C:2]-[C:3]O",
    conditions = "acid-aq-strong",
    also_attacks = { "other free alcohol", "primary amine" },
    recipe = "H2SO4, then NaOH; or PPh3, DIAD; or TsCl, Et3N",
    yield = { 55, 85 },
    cautions = { "aziridine (alkylating toxicant)", "sulfuric acid" },
    source = "Kürti, Czakó, Strategic Applications of Named Reactions in Organic Synthesis; from memory",
    example { "C1CN1Cc1ccc(Cl)cc1", from = { "OCCNCc1ccc(Cl)cc1" } },
    example { "C1CN1", from = { "NCCO" } },
    refuse { "C1CCN1" }, -- an azetidine
}

disconnection "gewald" {
    about = "Gewald aminothiophene synthesis; sulfur goes to the CH2 of the ketone",
    rxno = "RXNO:0000578",
    target = "s1:[c:2](-[NX3;H2:3]):[c;$(c-[$([CX3]=O),$(C#N)]):4]:[c;$(c-[#6]):5]:[c:6]:1",
    from = "[N:3]#[C:2]-[C:4].O=[C:5]-[C:6]",
    conditions = "amine-heat",
    recipe = "S8, morpholine or Et2NH, EtOH, 50 °C",
    yield = { 60, 90 },
    source = "Joule, Mills, Heterocyclic Chemistry; from memory",
    example { "CCOC(=O)c1c(N)sc2c1CCN(C(=O)OC(C)(C)C)C2", from = { "CCOC(=O)CC#N", "CC(C)(C)OC(=O)N1CCC(=O)CC1" } },
    example { "CCOC(=O)c1c(N)sc2CCCCc12", from = { "CCOC(=O)CC#N", "O=C1CCCCC1" } },
    refuse { "Nc1cccs1" }, -- no acceptor at C3
}

disconnection "feist-benary" {
    about = "Feist-Bénary furan synthesis; carbonyl carbon of the halide next to C3",
    rxno = "RXNO:0000501",
    target = "[o:1]1:[c;R1;$(c-[#6]):2]:[c;R1;$(c-[CX3]=O):3]:[c;R1:4]:[c;R1:5]:1",
    from = "[O:1]=[C:2]-[C:3].O=[C:4]-[C:5]Cl",
    conditions = "base-aq-mild",
    also_attacks = { "primary amine", "thiol", "other aldehyde" },
    recipe = "pyridine or NaOH aq. or NaOEt, rt; also: α-bromo ketone (base: alkylation and Paal-Knorr instead)",
    yield = { 50, 80 },
    cautions = { "chloroacetone (lachrymator)" },
    source = "Joule, Mills, Heterocyclic Chemistry; from memory",
    example { "CCOC(=O)c1c(C)coc1C", from = { "CCOC(=O)CC(C)=O", "CC(=O)CCl" } },
    example { "CCOC(=O)c1ccoc1C", from = { "CCOC(=O)CC(C)=O", "O=CCCl" } },
    refuse { "Cc1ccc(C)o1" }, -- no acyl group at C3: Paal-Knorr
}

disconnection "pechmann" {
    about = "Pechmann coumarin synthesis; ortho to one OH, para to the other",
    target = "[o:1]1:[c;R2:2]:[c;R2;$(c1:c:c:c(-[OX2,NX3]):c:c:1):3]:[c;R1:4]:[c;R1:5]:[c;R1:6]:1=[OX1:7]",
    from = "[O:1]-[c:2]:[cH:3].O=[C:4]-[C:5]-[C:6](=[O:7])OCC",
    conditions = "acid-aq-strong",
    also_attacks = { "free alcohol" },
    recipe = "conc. H2SO4 or MsOH or Amberlyst, 0-100 °C",
    yield = { 65, 95 },
    cautions = { "sulfuric acid" },
    source = "Vogel's Textbook of Practical Organic Chemistry; from memory",
    example { "Cc1cc(=O)oc2cc(O)ccc12", from = { "Oc1cccc(O)c1", "CCOC(=O)CC(C)=O" } },
    example { "Cc1cc(=O)oc2cc(N(CC)CC)ccc12", from = { "Oc1cccc(N(CC)CC)c1", "CCOC(=O)CC(C)=O" } },
    refuse { "Cc1cc(=O)oc2ccccc12" }, -- plain phenol reacts badly
}

disconnection "benzoxazole" {
    about = "Benzoxazole from an aminophenol and an acid; the amide forms first on nitrogen",
    target = "[o:1]1:[c;$(c1ccccc1):2]:[c;$(c1ccccc1):3]:[nX2:4]:[c;R1;$(c-[#6]):5]:1",
    from = "[O:1]-[c:2]:[c:3]-[N:4].O[C:5]=O",
    conditions = "acid-hot-dry",
    also_attacks = { "free alcohol", "nitrile" },
    recipe = "PPA or B(OH)3, xylene, 140-180 °C; acid chloride, then TsOH, toluene; also: aldehyde with DDQ",
    yield = { 60, 90 },
    cautions = { "polyphosphoric acid" },
    source = "Joule, Mills, Heterocyclic Chemistry; from memory",
    example { "O=C(O)c1ccc2oc(-c3cc(Cl)cc(Cl)c3)nc2c1", from = { "Nc1cc(C(=O)O)ccc1O", "O=C(O)c1cc(Cl)cc(Cl)c1" } },
    example { "Cc1nc2ccccc2o1", from = { "Nc1ccccc1O", "CC(=O)O" } },
    refuse { "Cc1ncc(C)o1" }, -- an oxazole
}

disconnection "benzothiazole" {
    about = "Benzothiazole from an aminothiophenol and an aldehyde; 2-substituted",
    target = "[s:1]1:[c;$(c1ccccc1):2]:[c;$(c1ccccc1):3]:[nX2:4]:[c;R1;$(c-[#6]):5]:1",
    from = "[S:1]-[c:2]:[c:3]-[N:4].O=[C:5]",
    conditions = "heat-200",
    also_attacks = { "other aldehyde", "enone", "alkyl halide", "acyl halide" },
    recipe = "DMSO, 120-170 °C, or air, K2CO3; H2O2, HCl; also: acid with PPA, acid chloride",
    yield = { 70, 95 },
    cautions = { "thiol (stench)" },
    source = "Joule, Mills, Heterocyclic Chemistry; from memory",
    example { "CN(C)c1ccc(-c2nc3ccccc3s2)cc1", from = { "Nc1ccccc1S", "CN(C)c1ccc(C=O)cc1" } },
    example { "c1ccc(cc1)-c1nc2ccccc2s1", from = { "Nc1ccccc1S", "O=Cc1ccccc1" } },
    refuse { "Cc1csc(C)n1" }, -- a thiazole
}

disconnection "imidazopyridine" {
    about = "Imidazo[1,2-a]pyridine from an aminopyridine and an α-bromo ketone; 2-substituted: the ring nitrogen is alkylated first",
    target = "[nX3;+0;R2:1]1:[c;R2:2]:[nX2:3]:[c;R1;$(c-[#6]):4]:[c;R1:5]:1",
    from = "[n:1]:[c:2]-[N:3].O=[C:4]-[C:5]Br",
    conditions = "amine-heat",
    also_attacks = { "primary amine", "thiol" },
    recipe = "EtOH, NaHCO3, reflux; also: α-chloro ketone",
    yield = { 65, 95 },
    cautions = { "α-bromo ketone (lachrymator)" },
    source = "Joule, Mills, Heterocyclic Chemistry; from memory",
    example { "Cc1ccc2nc(-c3ccc(C)cc3)cn2c1", from = { "Cc1ccc(N)nc1", "Cc1ccc(C(=O)CBr)cc1" } },
    example { "c1ccc(cc1)-c1cn2ccccc2n1", from = { "Nc1ccccn1", "O=C(CBr)c1ccccc1" } },
    refuse { "c1ccc2[nH]cnc2c1" }, -- a benzimidazole
}

disconnection "guareschi-imide" {
    about = "Guareschi imide from a ketone and two cyanoacetates; gem-disubstituted by the former ketone",
    target = "[C;X4;H0:1]1[C;X4;H1:2]([C;X2:3]#[N:4])[C;X3:5](=[O:6])[N;H1:7][C;X3:8](=[O:9])[C;X4;H1:10]1[C;X2:11]#[N:12]",
    from = "O=[C:1].[C:2]([C:3]#[N:4])[C:5](=[O:6])OCC.[N:7].[C:10]([C:11]#[N:12])[C:8](=[O:9])OCC",
    conditions = "amine-rt",
    also_attacks = { "other ester", "alkyl halide" },
    recipe = "NH3, EtOH, 0 °C, 2-7 days",
    yield = { 60, 80 },
    cautions = { "ammonia" },
    source = "Vogel's Textbook of Practical Organic Chemistry; from memory",
    example { "N#CC1C(=O)NC(=O)C(C#N)C12CCCCC2", from = { "O=C1CCCCC1", "CCOC(=O)CC#N", "N", "CCOC(=O)CC#N" } },
    example { "CCC1(C)C(C#N)C(=O)NC(=O)C1C#N", from = { "CCC(C)=O", "CCOC(=O)CC#N", "N", "CCOC(=O)CC#N" } },
    refuse { "O=C1CC2(CCCCC2)CC(=O)N1" }, -- without nitriles: from the glutaric anhydride
}

disconnection "reissert-indole" {
    about = "Reissert indole synthesis",
    rxno = "RXNO:0000395",
    target = "[nH;+0:1]1[c:2]([C;X3:3](=[O:4])[O:5])[cH:6][c;$(c1ccccc1):7][c;$(c1ccccc1):8]1",
    from = "[N+;H0:1](=O)([O-])-[c:8]:[c:7][C;H2:6][C:2](=O)[C:3](=[O:4])[O:5]",
    conditions = "fe-acid",
    also_attacks = { "aldehyde" },
    recipe = "Fe or Zn, AcOH, reflux; also: H2, Pd/C",
    yield = { 60, 85 },
    source = "Joule and Mills, Heterocyclic Chemistry; from memory",
    example { "CCOC(=O)c1cc2ccc(OC)cc2[nH]1", from = { "CCOC(=O)C(=O)Cc1ccc(OC)cc1[N+](=O)[O-]" } },
    example { "CCOC(=O)c1cc2ccccc2[nH]1", from = { "CCOC(=O)C(=O)Cc1ccccc1[N+](=O)[O-]" } },
    refuse { "CCOC(=O)c1ccc[nH]1" }, -- a pyrrole has no arene to carry the nitro group
}

disconnection "succinimide-from-anhydride" {
    about = "N-Substituted succinimide or maleimide from the anhydride; via the half-amide",
    target = "[N;X3;+0:1](-[#6;!$([#6]=[O,S,N]):9])1-[C;X3:2](=[O:3])-[C:4]~[C:5]-[C;X3:6](=[O:7])-1",
    from = "[N:1]-[#6:9].[C:2]1(=[O:3])[C:4]~[C:5][C:6](=[O:7])O1",
    conditions = "acid-hot-dry",
    also_attacks = { "other primary amine", "hydrazine", "thiol" },
    recipe = "AcOH reflux, or rt then Ac2O, NaOAc, 80 °C; also: diacid",
    yield = { 70, 90 },
    cautions = { "acetic anhydride" },
    source = "Vogel's Textbook of Practical Organic Chemistry; from memory",
    example { "O=C1C=CC(=O)N1c1ccc(C(=O)OC)cc1", from = { "COC(=O)c1ccc(N)cc1", "O=C1C=CC(=O)O1" } },
    example { "O=C1CCC(=O)N1c1ccccc1", from = { "Nc1ccccc1", "O=C1CCC(=O)O1" } },
    refuse { "O=C1NC(=O)c2ccccc12" }, -- an aromatic imide without N-substituent
}

disconnection "glutarimide-from-anhydride" {
    about = "N-Substituted glutarimide from the anhydride; via the half-amide",
    target = "[N;X3;+0:1](-[#6;!$([#6]=[O,S,N]):9])1-[C;X3:2](=[O:3])-[C;X4:4]-[C;X4:5]-[C;X4:8]-[C;X3:6](=[O:7])-1",
    from = "[N:1]-[#6:9].[C:2]1(=[O:3])[C:4][C:5][C:8][C:6](=[O:7])O1",
    conditions = "heat-200",
    also_attacks = { "other primary amine", "hydrazine" },
    recipe = "xylene, reflux, water removed; also: Ac2O reflux",
    yield = { 70, 90 },
    cautions = { "xylenes" },
    source = "Kleemann and Engel, Pharmaceutical Substances; from memory",
    example { "O=C1CC2(CCCC2)CC(=O)N1CCCCN1CCN(CC1)c1ncccn1",
        from = { "NCCCCN1CCN(CC1)c1ncccn1", "O=C1CC2(CCCC2)CC(=O)O1" } },
    example { "O=C1CCCC(=O)N1Cc1ccccc1", from = { "NCc1ccccc1", "O=C1CCCC(=O)O1" } },
    refuse { "O=C1CCCCN1C" }, -- a lactam, one carbonyl only
}

disconnection "staudinger-beta-lactam" {
    about = "Staudinger β-lactam synthesis; cis for alkoxy-, phenoxy- and phthalimidoketenes",
    target = "[N;X3:1]1([c:9])[C;X3:2](=[O:3])[C;X4;H1;$(C-[OX2,NX3,c]):4][C;X4;H1;$(C-[c,$([CX3]=[CX3])]):5]1",
    from = "[C:2](=[O:3])(Cl)[C;H2:4].[N:1]([c:9])=[C:5]",
    conditions = "acylation",
    recipe = "Et3N, CH2Cl2 or toluene, -78 °C to rt",
    yield = { 60, 88 },
    cautions = { "triethylamine" },
    source = "Kürti and Czakó, Strategic Applications of Named Reactions in Organic Synthesis; from memory",
    example { "COc1ccc(cc1)N1C(=O)C(Oc2ccccc2)C1c1ccc(F)cc1",
        from = { "O=C(Cl)COc1ccccc1", "COc1ccc(cc1)N=Cc1ccc(F)cc1" } },
    example { "O=C1C(Oc2ccccc2)C(c2ccccc2)N1c1ccccc1", from = { "O=C(Cl)COc1ccccc1", "C(=Nc1ccccc1)c1ccccc1" } },
    refuse { "CN1C(=O)CC1" }, -- made from the β-amino acid
}

disconnection "pyrimidine-guanidine-enaminone" {
    about = "2-Aminopyrimidine from a guanidine and an enaminone; 4-substituted, no isomers",
    rxno = "RXNO:0000400",
    target = "[n:1]1:[c:2]([N:3]):[n:4]:[cH:5]:[c:6]:[c:7]([#6:8])1",
    from = "[N;H1:1]=[C:2]([N:3])[N;H2:4].CN(C)[C;H1:5]=[C:6][C:7](=O)[#6:8]",
    conditions = "base-aq-strong",
    also_attacks = { "alkyl halide" },
    recipe = "NaOH or K2CO3, nBuOH or iPrOH, reflux",
    yield = { 60, 88 },
    cautions = { "sodium hydroxide" },
    source = "Kleemann and Engel, Pharmaceutical Substances; from memory",
    example { "Cc1ccc(cc1Nc1nccc(n1)-c1cccnc1)[N+](=O)[O-]",
        from = { "N=C(N)Nc1cc(ccc1C)[N+](=O)[O-]", "CN(C)C=CC(=O)c1cccnc1" } },
    example { "Nc1nccc(n1)-c1ccccc1", from = { "N=C(N)N", "CN(C)C=CC(=O)c1ccccc1" } },
    refuse { "Cc1cc(C)nc(N)n1" }, -- two substituents: from the 1,3-diketone
}

disconnection "pyrimidine-amidine-enamino-ester" {
    about = "Pyrimidine-5-carboxylate from an amidine and an aminomethylene keto ester; ketone closes before the ester",
    rxno = "RXNO:0000400",
    target = "[n:1]1:[c:2]([#6:3]):[n:4]:[cH:5]:[c:6]([C;X3:9](=[O:10])[O:11]):[c:7]([#6:8])1",
    from = "[N;H1:1]=[C:2]([#6:3])[N;H2:4].CN(C)[C;H1:5]=[C:6]([C:9](=[O:10])[O:11])[C:7](=O)[#6:8]",
    conditions = "alkoxide",
    recipe = "NaOEt or K2CO3, EtOH, rt to reflux; also: ethoxymethylene keto ester, guanidine",
    yield = { 65, 90 },
    source = "Joule and Mills, Heterocyclic Chemistry; from memory",
    example { "CCOC(=O)c1cnc(nc1C)-c1ccc(Cl)cc1", from = { "N=C(N)c1ccc(Cl)cc1", "CCOC(=O)C(=CN(C)C)C(C)=O" } },
    example { "CCOC(=O)c1cnc(nc1C)-c1ccccc1", from = { "N=C(N)c1ccccc1", "CCOC(=O)C(=CN(C)C)C(C)=O" } },
    refuse { "Cc1ccnc(C)n1" }, -- no ester at C5: from the enaminone
}

disconnection "pyrimidine-amino-nitrile" {
    about = "4-Aminopyrimidine-5-carbonitrile or -carboxylate from an amidine and an ethoxymethylene nitrile; nitrile closes to the amine",
    rxno = "RXNO:0000400",
    target = "[n:1]1:[c:2]([#6:3]):[n:4]:[cH:5]:[c:6]([C;$(C#N),$(C(=O)O):9]):[c:7]1[N;H2:8]",
    from = "[N;H1:1]=[C:2]([#6:3])[N;H2:4].CCO[C;H1:5]=[C:6]([C:9])[C:7]#[N;H0:8]",
    conditions = "alkoxide",
    recipe = "NaOEt, EtOH, 0 °C to reflux",
    yield = { 65, 88 },
    cautions = { "ethoxymethylenemalononitrile" },
    source = "Joule and Mills, Heterocyclic Chemistry; from memory",
    example { "Cc1ncc(C#N)c(N)n1", from = { "CC(=N)N", "CCOC=C(C#N)C#N" } },
    example { "CCOC(=O)c1cnc(C)nc1N", from = { "CC(=N)N", "CCOC=C(C#N)C(=O)OCC" } },
    refuse { "Cc1nccc(N)n1" }, -- no acceptor at C5
}

disconnection "diaminopyrimidine-guanidine" {
    about = "2,4-Diaminopyrimidine from guanidine and an alkoxymethylene nitrile",
    rxno = "RXNO:0000400",
    target = "[n:1]1:[c:2]([N;H2:3]):[n:4]:[c:5]:[c:6]([#6:9]):[c:7]1[N;H2:8]",
    from = "[N;H1:1]=[C:2]([N;H2:3])[N;H2:4].[C;H3]O[C:5]=[C:6]([#6:9])[C:7]#[N;H0:8]",
    conditions = "alkoxide",
    recipe = "NaOMe, MeOH, reflux; also: enol ether of a β-keto nitrile, anilino acrylonitrile",
    yield = { 65, 88 },
    cautions = { "sodium methoxide" },
    source = "Kleemann and Engel, Pharmaceutical Substances; from memory",
    example { "COc1cc(Cc2cnc(N)nc2N)cc(OC)c1OC", from = { "N=C(N)N", "COC=C(C#N)Cc1cc(OC)c(OC)c(OC)c1" } },
    example { "CCc1nc(N)nc(N)c1-c1ccc(Cl)cc1", from = { "N=C(N)N", "CCC(OC)=C(C#N)c1ccc(Cl)cc1" } },
    refuse { "Nc1ccnc(N)n1" }, -- nothing at C5: from 2,4-dichloropyrimidine
}

disconnection "aminouracil-traube" {
    about = "6-Aminouracil from a urea and ethyl cyanoacetate (Traube); unsymmetrical ureas: substituted nitrogen next to the amino group",
    rxno = "RXNO:0000400",
    target = "[n;X3:1]1([C;X4:10]):[c:2](=[O:3]):[n;X3:4]([C;X4:11]):[c:5]([N;H2:9]):[cH:6]:[c:7]1=[O:8]",
    from = "[N;H1:1]([C:10])[C:2](=[O:3])[N;H1:4][C:11].[N;H0:9]#[C:5][C;H2:6][C:7](=[O:8])OCC",
    conditions = "alkoxide",
    also_attacks = { "primary amine", "free alcohol" },
    recipe = "NaOEt, EtOH, reflux; also: cyanoacetic acid with Ac2O at 60-80 °C, then NaOH",
    yield = { 70, 90 },
    source = "Vogel's Textbook of Practical Organic Chemistry; from memory",
    example { "Cn1c(N)cc(=O)n(C)c1=O", from = { "CNC(=O)NC", "CCOC(=O)CC#N" } },
    example { "CCn1c(N)cc(=O)n(CC)c1=O", from = { "CCNC(=O)NCC", "CCOC(=O)CC#N" } },
    refuse { "Cn1ccc(=O)n(C)c1=O" }, -- no amino group
}

disconnection "pyrazole-enaminone" {
    about = "NH-Pyrazole from hydrazine and an enaminone; tautomers of one compound",
    rxno = "RXNO:0000392",
    target = "[nH:1]1:[n:2]:[c:3]([#6:6]):[c:4]:[cH:5]:1",
    from = "[N;H2:1][N;H2:2].O=[C:3]([#6:6])[C:4]=[C;H1:5]N(C)C",
    conditions = "hydrazine",
    recipe = "N2H4·H2O, EtOH or AcOH, reflux",
    yield = { 80, 95 },
    cautions = { "hydrazine" },
    source = "Joule and Mills, Heterocyclic Chemistry; from memory",
    example { "Brc1ccc(cc1)-c1cc[nH]n1", from = { "NN", "CN(C)C=CC(=O)c1ccc(Br)cc1" } },
    example { "c1ccc(cc1)-c1cc[nH]n1", from = { "NN", "CN(C)C=CC(=O)c1ccccc1" } },
    refuse { "c1c[nH]cn1" }, -- an imidazole
}

disconnection "aminopyrazole-ethoxymethylene" {
    about = "5-Aminopyrazole-4-carboxylate or -carbonitrile from an ethoxymethylene nitrile; 1-substituted 5-amino isomer",
    rxno = "RXNO:0000392",
    target = "[n;X3:1]1([#6:9]):[n:2]:[cH:3]:[c:4]([C;$(C#N),$(C(=O)O):6]):[c:5]1[N;H2:8]",
    from = "[N;H1:1]([#6:9])[N;H2:2].CCO[C;H1:3]=[C:4]([C:6])[C:5]#[N;H0:8]",
    conditions = "acid-hot-dry",
    also_attacks = { "imide" },
    recipe = "EtOH, reflux; also: NaOAc with the hydrazine salt",
    yield = { 70, 92 },
    source = "Joule and Mills, Heterocyclic Chemistry; from memory",
    example { "CCOC(=O)c1cnn(-c2ccc(F)cc2)c1N", from = { "NNc1ccc(F)cc1", "CCOC=C(C#N)C(=O)OCC" } },
    example { "CCOC(=O)c1cnn(-c2ccccc2)c1N", from = { "NNc1ccccc1", "CCOC=C(C#N)C(=O)OCC" } },
    refuse { "Nc1ccnn1C" }, -- no acceptor at C4
}

disconnection "aminopyrazole-keto-nitrile" {
    about = "5-Aminopyrazole from a hydrazine and a β-keto nitrile; 1-substituted 5-amino isomer",
    rxno = "RXNO:0000392",
    target = "[n;X3:1]1([#6:9]):[n:2]:[c:3]([#6:6]):[cH:4]:[c:5]1[N;H2:8]",
    from = "[N;H1:1]([#6:9])[N;H2:2].[#6:6][C:3](=O)[C;H2:4][C:5]#[N;H0:8]",
    conditions = "acid-hot-dry",
    also_attacks = { "imide" },
    recipe = "HCl (cat.), EtOH or toluene, reflux",
    yield = { 75, 93 },
    cautions = { "hydrochloric acid" },
    source = "Kleemann and Engel, Pharmaceutical Substances; from memory",
    example { "Cc1ccc(cc1)-n1nc(cc1N)C(C)(C)C", from = { "Cc1ccc(NN)cc1", "CC(C)(C)C(=O)CC#N" } },
    example { "CC(C)(C)c1cc(N)n(n1)-c1ccccc1", from = { "NNc1ccccc1", "CC(C)(C)C(=O)CC#N" } },
    refuse { "Nc1ccnn1C" }, -- no substituent at C3: from the alkoxyacrylonitrile
}

disconnection "isoxazole-ethoxymethylene" {
    about = "Isoxazole-4-carboxylate from hydroxylamine and an ethoxymethylene keto ester; 5-substituted isomer at low temperature",
    target = "[o:1]1:[n:2]:[cH:3]:[c:4]([C;X3:6](=[O:7])[O:8]):[c:5]1[#6:9]",
    from = "[O;H1:1][N;H2:2].CCO[C;H1:3]=[C:4]([C:6](=[O:7])[O:8])[C:5](=O)[#6:9]",
    conditions = "acid-aq-mild",
    also_attacks = { "aldehyde", "other ketone" },
    recipe = "NH2OH·HCl, NaOAc, MeOH/H2O, -10 to 0 °C",
    yield = { 70, 90 },
    cautions = { "hydroxylamine hydrochloride" },
    source = "Kleemann and Engel, Pharmaceutical Substances; from memory",
    example { "CCOC(=O)c1cnoc1C", from = { "NO", "CCOC=C(C(C)=O)C(=O)OCC" } },
    example { "CCOC(=O)c1cnoc1-c1ccccc1", from = { "NO", "CCOC=C(C(=O)c1ccccc1)C(=O)OCC" } },
    refuse { "Cc1ccno1" }, -- no ester at C4
}

disconnection "aminoisoxazole-keto-nitrile" {
    about = "5-Aminoisoxazole from hydroxylamine and a β-keto nitrile; 5-amino isomer from alkaline solution (pH 10 and above); pH 7-8, then acid, gives the 3-amino isomer",
    target = "[o:1]1:[n:2]:[c:3]([#6:6]):[c:4]:[c:5]1[N;H2:8]",
    from = "[O;H1:1][N;H2:2].[#6:6][C:3](=O)[C:4][C:5]#[N;H0:8]",
    conditions = "base-aq-strong",
    also_attacks = { "other ketone" },
    recipe = "NH2OH·HCl, NaOH, EtOH/H2O, reflux",
    yield = { 65, 88 },
    cautions = { "hydroxylamine hydrochloride", "sodium hydroxide" },
    source = "Joule and Mills, Heterocyclic Chemistry; from memory",
    example { "CC(C)(C)c1cc(N)on1", from = { "NO", "CC(C)(C)C(=O)CC#N" } },
    example { "Nc1cc(no1)-c1ccccc1", from = { "NO", "N#CCC(=O)c1ccccc1" } },
    refuse { "CC(C)(C)c1cc(N)no1" }, -- 3-aminoisoxazole: needs the other order of addition
}

disconnection "imidazole-amidine-haloketone" {
    about = "Imidazole from an amidine and an α-bromo ketone; tautomers of one compound",
    rxno = "RXNO:0000613",
    target = "[nH:1]1:[c:2]([#6:6]):[n:3]:[c:4]([#6:7]):[cH:5]:1",
    from = "[N;H2:1][C:2]([#6:6])=[N;H1:3].O=[C:4]([#6:7])[C;H2:5]Br",
    conditions = "base-aq-mild",
    also_attacks = { "alkyl halide", "primary amine", "phenol", "thiol", "free acid", "epoxide", "thioamide" },
    recipe = "KHCO3 or K2CO3, THF/H2O, reflux",
    yield = { 55, 85 },
    source = "Joule and Mills, Heterocyclic Chemistry; from memory",
    example { "Fc1ccc(cc1)-c1c[nH]c(n1)C1CC1", from = { "N=C(N)C1CC1", "O=C(CBr)c1ccc(F)cc1" } },
    example { "c1ccc(cc1)-c1c[nH]c(n1)-c1ccccc1", from = { "N=C(N)c1ccccc1", "O=C(CBr)c1ccccc1" } },
    refuse { "c1c[nH]cn1" }, -- no substituents to place
}

disconnection "marckwald-imidazolethione" {
    about = "2-Mercaptoimidazole from an aminoacetal and thiocyanate (Marckwald); thione tautomer",
    rxno = "RXNO:0000613",
    target = "[n;X3:1]1([#6:6]):[c:2](=[S;+0:3]):[nH;+0:4]:[cH:8]:[cH:7]:1",
    from = "[N;H1:1]([#6:6])[C;H2:7][C;H1:8](OCC)OCC.[S-:3][C:2]#[N:4].[K+]",
    conditions = "acid-aq-strong",
    also_attacks = { "primary amine" },
    recipe = "KSCN, aq. HCl, reflux",
    yield = { 65, 88 },
    cautions = { "hydrochloric acid" },
    source = "Kleemann and Engel, Pharmaceutical Substances; from memory",
    example { "Cn1cc[nH]c1=S", from = { "CCOC(OCC)CNC", "[K+].[S-]C#N" } },
    example { "S=c1[nH]ccn1Cc1ccccc1", from = { "CCOC(CNCc1ccccc1)OCC", "[K+].[S-]C#N" } },
    refuse { "Cn1ccnc1" }, -- no sulfur
}

disconnection "van-leusen-imidazole" {
    about = "Imidazole from an aldimine and TosMIC (van Leusen); 1,5-disubstituted",
    rxno = "RXNO:0000613",
    target = "[n;X3:1]1([#6:6]):[cH;+0:2]:[n;+0:3]:[cH:4]:[c:5]1[#6:7]",
    from = "[N:1]([#6:6])=[C;H1:5][#6:7].[C-;H0:2]#[N+;H0:3][C;H2:4]S(=O)(=O)c1ccc(C)cc1",
    conditions = "base-aq-mild",
    also_attacks = { "aldehyde", "ketone", "alkyl halide" },
    recipe = "K2CO3, MeOH/DME or DMF, reflux",
    yield = { 65, 88 },
    cautions = { "N,N-dimethylformamide" },
    source = "Joule and Mills, Heterocyclic Chemistry; from memory",
    example { "Fc1ccc(cc1)-c1cncn1C1CCCCC1", from = { "Fc1ccc(C=NC2CCCCC2)cc1", "[C-]#[N+]CS(=O)(=O)c1ccc(C)cc1" } },
    example { "Cn1cncc1-c1ccccc1", from = { "CN=Cc1ccccc1", "[C-]#[N+]CS(=O)(=O)c1ccc(C)cc1" } },
    refuse { "Cn1ccnc1" }, -- no carbon substituent at C5
}

disconnection "diaminotriazine-acyl-cyanide" {
    about = "3,5-Diamino-1,2,4-triazine from an acyl cyanide and aminoguanidine; hydrazone first, then ring closure on the nitrile",
    rxno = "RXNO:0000401",
    target = "[n:1]1:[n:2]:[c:3]([N;H2:4]):[n:5]:[c:6]([N;H2:7]):[c:8]1[c:9]",
    from = "[N;H2:1][N;H1:2][C:3](=[N;H1:5])[N;H2:4].[c:9][C:8](=O)[C:6]#[N;H0:7]",
    conditions = "acid-aq-strong",
    also_attacks = { "aldehyde", "ketone" },
    recipe = "aminoguanidine bicarbonate, H2SO4 or CH3SO3H, then base, nPrOH reflux",
    yield = { 55, 80 },
    cautions = { "sulfuric acid" },
    source = "Kleemann and Engel, Pharmaceutical Substances; from memory",
    example { "Nc1nnc(c(N)n1)-c1cccc(Cl)c1Cl", from = { "NNC(=N)N", "N#CC(=O)c1cccc(Cl)c1Cl" } },
    example { "Nc1nnc(c(N)n1)-c1ccccc1", from = { "NNC(=N)N", "N#CC(=O)c1ccccc1" } },
    refuse { "Nc1nncc(N)n1" }, -- no aryl group
}

disconnection "aminotriazine-diketone" {
    about = "3-Amino-1,2,4-triazine from a 1,2-diketone and aminoguanidine; isomers from an unsymmetrical diketone",
    rxno = "RXNO:0000401",
    target = "[n:1]1:[n:2]:[c:3]([N;H2:4]):[n:5]:[c:6]([#6:7]):[c:8]1[#6:9]",
    from = "[N;H2:1][N;H1:2][C:3](=[N;H1:5])[N;H2:4].O=[C:6]([#6:7])[C:8](=O)[#6:9]",
    conditions = "acid-aq-mild",
    also_attacks = { "aldehyde", "other ketone" },
    recipe = "aminoguanidine bicarbonate, AcOH or EtOH, reflux",
    yield = { 70, 90 },
    source = "Joule and Mills, Heterocyclic Chemistry; from memory",
    example { "Nc1nnc(c2ccc(F)cc2)c(n1)-c1ccc(F)cc1", from = { "NNC(=N)N", "O=C(C(=O)c1ccc(F)cc1)c1ccc(F)cc1" } },
    example { "Nc1nnc(c(n1)-c1ccccc1)-c1ccccc1", from = { "NNC(=N)N", "O=C(C(=O)c1ccccc1)c1ccccc1" } },
    refuse { "Nc1nncc(N)n1" }, -- two amino groups: from an acyl cyanide
}

disconnection "mercaptotriazole" {
    about = "1,2,4-Triazole-3-thione from an acylthiosemicarbazide; acid closes the thiadiazole instead",
    target = "[nH:1]1:[n:2]:[c:3]([#6:9]):[n;X3:4]([#6:10]):[c:5]1=[S:6]",
    from = "[N;H1:1]([N;H1:2][C:3](=O)[#6:9])[C:5](=[S:6])[N;H1:4][#6:10]",
    conditions = "base-aq-strong",
    also_attacks = { "epoxide", "alkyl halide" },
    recipe = "aq. NaOH or K2CO3, reflux, then acid",
    yield = { 75, 93 },
    cautions = { "sodium hydroxide" },
    source = "Joule and Mills, Heterocyclic Chemistry; from memory",
    example { "CCn1c(n[nH]c1=S)-c1ccncc1", from = { "CCNC(=S)NNC(=O)c1ccncc1" } },
    example { "Cn1c(n[nH]c1=S)-c1ccccc1", from = { "CNC(=S)NNC(=O)c1ccccc1" } },
    refuse { "Cn1cnnc1" }, -- no sulfur
}

disconnection "guanamine" {
    about = "2,4-Diamino-1,3,5-triazine from a nitrile and dicyandiamide",
    rxno = "RXNO:0000401",
    target = "[n:1]1:[c:2]([N;H2:3]):[n:4]:[c:5]([N;H2:6]):[n:7]:[c:8]1[#6:9]",
    from = "[N;H2:1][C:2]([N;H2:3])=[N:4][C:5]#[N;H0:6].[#6:9][C:8]#[N;H0:7]",
    conditions = "base-aq-strong",
    also_attacks = { "alkyl halide", "other nitrile" },
    recipe = "KOH, 2-methoxyethanol or DMSO, 100-120 °C",
    yield = { 75, 92 },
    cautions = { "potassium hydroxide", "dimethyl sulfoxide" },
    source = "Vogel's Textbook of Practical Organic Chemistry; from memory",
    example { "Nc1nc(N)nc(n1)-c1ccc(Br)cc1", from = { "NC(N)=NC#N", "N#Cc1ccc(Br)cc1" } },
    example { "Nc1nc(N)nc(n1)-c1ccccc1", from = { "NC(N)=NC#N", "N#Cc1ccccc1" } },
    refuse { "Nc1ncncn1" }, -- only one amino group
}

disconnection "hugershoff-aminobenzothiazole" {
    about = "2-Aminobenzothiazole from an arylthiourea (Hugershoff); ortho position; isomers from meta-substituted anilines",
    target = "[s:1]1:[c:2]([N;X3:3]):[n:4]:[c;$(c1ccccc1):5]:[c;$(c1ccccc1):6]:1",
    from = "[S:1]=[C:2]([N:3])[N;H1:4]-[c:5]:[cH:6]",
    conditions = "br2",
    recipe = "Br2, CHCl3 or AcOH, 0 °C to reflux; also: NBS, I2/DMSO, SO2Cl2",
    yield = { 70, 90 },
    cautions = { "bromine" },
    source = "Joule and Mills, Heterocyclic Chemistry; from memory",
    example { "Clc1ccc2nc(sc2c1)N1CCCC1", from = { "S=C(Nc1ccc(Cl)cc1)N1CCCC1" } },
    example { "c1ccc2sc(Nc3ccccc3)nc2c1", from = { "S=C(Nc1ccccc1)Nc1ccccc1" } },
    refuse { "Nc1nccs1" }, -- a thiazole: from thiourea and a haloaldehyde
}

disconnection "aminobenzothiazole-thiocyanate" {
    about = "2-Aminobenzothiazole from a para-substituted aniline and thiocyanate; ortho to nitrogen",
    target = "[s;+0:1]1:[c:2]([N;H2;+0:3]):[n:4]:[c;$(c1ccc(-[#6,#8,F,Cl,Br])cc1):5]:[c;$(c1ccccc1):6]:1",
    from = "[S-:1][C:2]#[N;H0:3].[N;H2:4]-[c:5]:[cH:6].[K+]",
    conditions = "br2",
    recipe = "KSCN (2-4 equiv.), Br2, AcOH, 0-25 °C",
    yield = { 60, 85 },
    cautions = { "bromine" },
    source = "Kleemann and Engel, Pharmaceutical Substances; from memory",
    example { "Nc1nc2ccc(OC(F)(F)F)cc2s1", from = { "[K+].[S-]C#N", "Nc1ccc(OC(F)(F)F)cc1" } },
    example { "COc1ccc2nc(N)sc2c1", from = { "[K+].[S-]C#N", "COc1ccc(N)cc1" } },
    refuse { "Nc1nc2ccccc2s1" }, -- para position free: thiocyanation goes there
}

disconnection "oxazolidinone-glycidyl" {
    about = "5-Hydroxymethyloxazolidinone from an aryl carbamate and glycidyl butyrate (Manninen); (R)-glycidyl butyrate gives the (R)-alcohol",
    target = "[c:7][N:4]1[C;X3:2](=[O:3])[O:1][C;X4;H1:6]([C;H2:8][O;H1:9])[C;H2:5]1",
    from = "[c:7][N;H1:4][C:2](=[O:3])OCc1ccccc1.[C;H2:5]1[C;H1:6]([C:8][O;H0:9]C(=O)CCC)[O:1]1",
    conditions = "organolithium",
    also_attacks = { "epoxide" },
    recipe = "nBuLi, THF, -78 °C to rt",
    yield = { 75, 92 },
    cautions = { "butyllithium" },
    source = "Kleemann and Engel, Pharmaceutical Substances; from memory",
    example { "OCC1CN(C(=O)O1)c1ccc(N2CCOCC2)c(F)c1",
        from = { "O=C(Nc1ccc(N2CCOCC2)c(F)c1)OCc1ccccc1", "CCCC(=O)OCC1CO1" } },
    example { "OCC1CN(C(=O)O1)c1ccccc1", from = { "O=C(Nc1ccccc1)OCc1ccccc1", "CCCC(=O)OCC1CO1" } },
    refuse { "O=C1OCCN1c1ccccc1" }, -- no hydroxymethyl group
}

disconnection "hydantoin-isocyanate" {
    about = "Hydantoin from an amino ester and an isocyanate; via the urea, closed by acid or base",
    target = "[N;X3;!$(N(C=O)C=O):1]1[C;X3:2](=[O:3])[N:4]([#6;$(c),$([CX4]):8])[C;X3:5](=[O:6])[C;X4:7]1",
    from = "[N:1][C:7][C:5](=[O:6])OC.[#6:8][N;H0:4]=[C:2]=[O:3]",
    conditions = "acid-aq-strong",
    also_attacks = { "other primary amine", "free alcohol", "phenol", "thiol" },
    recipe = "Et3N, THF, rt, then HCl reflux or KOtBu; also: free amino acid, CDI and amine",
    yield = { 70, 92 },
    cautions = { "isocyanates", "hydrochloric acid", "potassium tert-butoxide", "triethylamine" },
    source = "Joule and Mills, Heterocyclic Chemistry; from memory",
    example { "O=C1N(c2cccc(Cl)c2)C(=O)C2CCCN12", from = { "COC(=O)C1CCCN1", "O=C=Nc1cccc(Cl)c1" } },
    example { "CC1NC(=O)N(c2ccccc2)C1=O", from = { "COC(=O)C(C)N", "O=C=Nc1ccccc1" } },
    refuse { "O=C1CNC(=O)N1" }, -- N3 bears no substituent
}

disconnection "chromone-dmf-dma" {
    about = "Chromone or isoflavone from a 2-hydroxyaryl ketone and DMF dimethyl acetal",
    target = "[o:1]1:[c;$(c1ccccc1):2]:[c;$(c1ccccc1):3]:[c:4](=[O:5]):[c:6]:[cH:7]:1",
    from = "[O;H1:1]-[c:2]:[c:3]-[C:4](=[O:5])-[C:6].[C;H1:7](OC)(OC)N(C)C",
    conditions = "acid-hot-dry",
    also_attacks = { "other phenol", "primary amine", "NH azole" },
    recipe = "neat or toluene, 80-110 °C, then HCl; also: HC(OEt)3/HClO4, DMF/MsCl/BF3·OEt2",
    yield = { 70, 92 },
    cautions = { "hydrochloric acid" },
    source = "Joule and Mills, Heterocyclic Chemistry; from memory",
    example { "COc1ccc(cc1)-c1coc2cc(OC)ccc2c1=O", from = { "COc1ccc(cc1)CC(=O)c1ccc(OC)cc1O", "COC(OC)N(C)C" } },
    example { "O=c1c(coc2ccccc12)-c1ccccc1", from = { "O=C(Cc1ccccc1)c1ccccc1O", "COC(OC)N(C)C" } },
    refuse { "Cc1cc(=O)c2ccccc2o1" }, -- C2 bears a substituent
}

disconnection "flavanone-closure" {
    about = "Flavanone from a 2'-hydroxychalcone; racemic; equilibrium with the chalcone",
    target = "[O;X2:1]1[c:2]:[c:3][C;X3:4](=[O:5])[C;X4;H2:6][C;X4;H1:7]1[c:8]",
    from = "[O;H1:1][c:2]:[c:3][C:4](=[O:5])[C;H1:6]=[C;H1:7][c:8]",
    conditions = "acid-hot-dry",
    also_attacks = { "thiol", "primary amine" },
    recipe = "NaOAc, EtOH or AcOH, reflux; also: H2SO4, H3PO4",
    yield = { 50, 80 },
    source = "March's Advanced Organic Chemistry; from memory",
    example { "COc1ccc(cc1)C1CC(=O)c2ccc(OC)cc2O1", from = { "COc1ccc(cc1)C=CC(=O)c1ccc(OC)cc1O" } },
    example { "O=C1CC(Oc2ccccc12)c1ccccc1", from = { "O=C(C=Cc1ccccc1)c1ccccc1O" } },
    refuse { "CC1CC(=O)c2ccccc2O1" }, -- no aryl group at C2
}

disconnection "kabbe-chromanone" {
    about = "4-Chromanone from a 2'-hydroxyacetophenone and a ketone (Kabbe)",
    target = "[O;X2:1]1[c:2]:[c:3][C;X3:4](=[O:5])[C;X4;H2:6][C;X4;H0:7]1([#6:8])[#6:9]",
    from = "[O;H1:1][c:2]:[c:3][C:4](=[O:5])[C;H3:6].O=[C:7]([#6:8])[#6:9]",
    conditions = "amine-heat",
    also_attacks = { "primary amine" },
    recipe = "pyrrolidine, MeOH or toluene, reflux",
    yield = { 70, 92 },
    source = "Joule and Mills, Heterocyclic Chemistry; from memory",
    example { "CC(C)(C)OC(=O)N1CCC2(CC1)CC(=O)c1ccccc1O2",
        from = { "CC(=O)c1ccccc1O", "CC(C)(C)OC(=O)N1CCC(=O)CC1" } },
    example { "CC1(C)CC(=O)c2ccccc2O1", from = { "CC(=O)c1ccccc1O", "CC(C)=O" } },
    refuse { "CC1CC(=O)c2ccccc2O1" }, -- only one substituent: from an aldehyde
}

disconnection "fischer-indole-aldehyde" {
    about = "3-Substituted indole from an arylhydrazine and an aldehyde (Fischer indole synthesis); no substituent at C2; para-substituted hydrazines give one isomer",
    rxno = "RXNO:0000064",
    target = "[nH:1]1:[c;$(c1ccccc1):2]:[c;$(c1ccccc1):3]:[c:4]([C;X4:6]):[cH:5]:1",
    from = "[N;H1:1](N)-[c:2]:[cH:3].O=[C;H1:5][C;H2:4][C:6]",
    conditions = "acid-aq-strong",
    also_attacks = { "other ketone" },
    recipe = "aq. H2SO4 or HCl, 60-90 °C, aldehyde as its acetal; also: PPA ester, H3PO4",
    yield = { 40, 70 },
    cautions = { "phenylhydrazines", "sulfuric acid", "hydrochloric acid" },
    source = "Kleemann and Engel, Pharmaceutical Substances; from memory",
    example { "CNS(=O)(=O)Cc1ccc2[nH]cc(CCN(C)C)c2c1", from = { "CNS(=O)(=O)Cc1ccc(NN)cc1", "CN(C)CCCC=O" } },
    example { "Cc1c[nH]c2ccccc12", from = { "NNc1ccccc1", "CCC=O" } },
    refuse { "c1ccc2[nH]ccc2c1" }, -- from acetaldehyde: the parent indole does not form so
}

disconnection "conrad-limpach" {
    about = "Conrad-Limpach quinolone synthesis; enamine at rt, thermal closure to the 4-quinolone",
    rxno = "RXNO:0000641",
    target = "[nH:1]1:[c;$(c1ccccc1):2]:[c;$(c1ccccc1):3]:[c:4](=[O:5]):[c:6]:[c:7]1[#6:8]",
    from = "[N;H2:1]-[c:2]:[cH:3].CCO[C:4](=[O:5])[C:6][C:7](=O)[#6:8]",
    conditions = "heat-200",
    also_attacks = { "aldehyde", "other primary amine", "acyl halide" },
    recipe = "AcOH (cat.), toluene reflux, then Dowtherm or diphenyl ether, 250 °C",
    yield = { 60, 85 },
    source = "Kürti and Czakó, Strategic Applications of Named Reactions in Organic Synthesis; from memory",
    example { "COc1ccc2[nH]c(C)cc(=O)c2c1", from = { "COc1ccc(N)cc1", "CCOC(=O)CC(C)=O" } },
    example { "Cc1cc(=O)c2ccccc2[nH]1", from = { "Nc1ccccc1", "CCOC(=O)CC(C)=O" } },
    refuse { "O=c1cc[nH]c2ccccc12" }, -- no substituent at C2: Gould-Jacobs
}

disconnection "knorr-quinoline" {
    about = "Knorr quinoline synthesis (2-quinolone); anilide at 140 °C, closed by acid to the 2-quinolone",
    rxno = "RXNO:0000394",
    target = "[nH:1]1:[c;$(c1ccccc1):2]:[c;$(c1ccccc1):3]:[c:4]([#6:8]):[c:6]:[c:7]1=[O:5]",
    from = "[N;H2:1]-[c:2]:[cH:3].CCO[C:7](=[O:5])[C:6][C:4](=O)[#6:8]",
    conditions = "acid-aq-strong",
    also_attacks = { "other primary amine" },
    recipe = "xylene, 140 °C, then H2SO4 or PPA, 90-100 °C",
    yield = { 55, 80 },
    cautions = { "sulfuric acid" },
    source = "Kürti and Czakó, Strategic Applications of Named Reactions in Organic Synthesis; from memory",
    example { "COc1ccc2[nH]c(=O)cc(C)c2c1", from = { "COc1ccc(N)cc1", "CCOC(=O)CC(C)=O" } },
    example { "Cc1cc(=O)[nH]c2ccccc12", from = { "Nc1ccccc1", "CCOC(=O)CC(C)=O" } },
    refuse { "O=c1ccc2ccccc2[nH]1" }, -- no substituent at C4
}

disconnection "quinolone-snar-closure" {
    about = "4-Quinolone-3-carboxylate by intramolecular SNAr of an enaminone; halogen ortho to the ketone is displaced",
    target = "[n;X3:1]1([#6:9]):[c;$(c1ccccc1):2]:[c;$(c1ccccc1):3]:[c:4](=[O:5]):[c:6]:[cH:7]:1",
    from = "[N;H1:1]([#6:9])[C;H1:7]=[C:6][C:4](=[O:5])[c:3]:[c:2]Cl",
    conditions = "amine-heat",
    recipe = "K2CO3, DMF, 80-140 °C; also: NaH/dioxane, DBU, 2-fluoro compound",
    yield = { 75, 93 },
    cautions = { "N,N-dimethylformamide" },
    source = "Kleemann and Engel, Pharmaceutical Substances; from memory",
    example { "CCOC(=O)c1cn(C2CC2)c2cc(Cl)c(F)cc2c1=O", from = { "CCOC(=O)C(=CNC1CC1)C(=O)c1cc(F)c(Cl)cc1Cl" } },
    example { "CCOC(=O)c1cn(CC)c2cc(F)c(F)cc2c1=O", from = { "CCOC(=O)C(=CNCC)C(=O)c1cc(F)c(F)cc1Cl" } },
    refuse { "O=c1cc[nH]c2ccccc12" }, -- no N-substituent: Gould-Jacobs
}

disconnection "indazole-from-fluoroaldehyde" {
    about = "1H-Indazole from a 2-fluorobenzaldehyde and hydrazine; 1H tautomer",
    rxno = "RXNO:0000614",
    target = "[nH:1]1:[n:2]:[cH:3]:[c;$(c1ccccc1):4]:[c;$(c1ccccc1):5]:1",
    from = "[N;H2:1][N;H2:2].O=[C;H1:3]-[c:4]:[c:5]F",
    conditions = "hydrazine",
    recipe = "N2H4·H2O, DMSO or neat, 100-120 °C; also: O-methyloxime route, ketone for 3-alkyl",
    yield = { 60, 88 },
    cautions = { "hydrazine", "dimethyl sulfoxide" },
    source = "Joule and Mills, Heterocyclic Chemistry; from memory",
    example { "Brc1ccc2[nH]ncc2c1", from = { "NN", "O=Cc1cc(Br)ccc1F" } },
    example { "c1ccc2[nH]ncc2c1", from = { "NN", "O=Cc1ccccc1F" } },
    refuse { "c1cn[nH]c1" }, -- a pyrazole, no benzo ring
}

disconnection "aminoindazole-from-fluoronitrile" {
    about = "3-Aminoindazole from a 2-fluorobenzonitrile and hydrazine",
    rxno = "RXNO:0000614",
    target = "[nH:1]1:[n:2]:[c:3]([N;H2:6]):[c;$(c1ccccc1):4]:[c;$(c1ccccc1):5]:1",
    from = "[N;H2:1][N;H2:2].[N;H0:6]#[C:3]-[c:4]:[c:5]F",
    conditions = "hydrazine",
    recipe = "N2H4·H2O, nBuOH or EtOH, reflux",
    yield = { 70, 92 },
    cautions = { "hydrazine" },
    source = "Joule and Mills, Heterocyclic Chemistry; from memory",
    example { "Nc1n[nH]c2cc(Br)ccc12", from = { "NN", "N#Cc1ccc(Br)cc1F" } },
    example { "Nc1n[nH]c2ccccc12", from = { "NN", "N#Cc1ccccc1F" } },
    refuse { "Nc1cc[nH]n1" }, -- a pyrazole, no benzo ring
}

disconnection "benzisoxazole-from-oxime" {
    about = "1,2-Benzisoxazole from a 2-fluoroaryl ketoxime; oxime OH anti to the alkyl group closes",
    target = "[o:1]1:[n:2]:[c:3]([#6:6]):[c;$(c1ccccc1):4]:[c;$(c1ccccc1):5]:1",
    from = "[O;H1:1][N:2]=[C:3]([#6:6])-[c:4]:[c:5]F",
    conditions = "base-aq-strong",
    also_attacks = { "alkyl halide", "nitrile" },
    recipe = "KOH, EtOH/H2O, reflux; also: NaH/DMF, 2-chloro compound",
    yield = { 65, 90 },
    cautions = { "potassium hydroxide" },
    source = "Kleemann and Engel, Pharmaceutical Substances; from memory",
    example { "Fc1ccc2c(noc2c1)C1CCNCC1", from = { "ON=C(C1CCNCC1)c1ccc(F)cc1F" } },
    example { "c1ccc(cc1)-c1noc2ccccc12", from = { "ON=C(c1ccccc1)c1ccccc1F" } },
    refuse { "Cc1ccon1" }, -- an isoxazole, no benzo ring
}

disconnection "benzothiophene-thioglycolate" {
    about = "Benzothiophene-2-carboxylate from a 2-fluorobenzaldehyde and a thioglycolate; SNAr, then aldol condensation",
    target = "[s:1]1:[c:2]([C;X3:7](=[O:8])[O:9]):[c:3]:[c;$(c1ccccc1):4]:[c;$(c1ccccc1):5]:1",
    from = "[S;H1:1][C;H2:2][C:7](=[O:8])[O:9].O=[C:3]-[c:4]:[c:5]F",
    conditions = "alkylation",
    also_attacks = { "other aldehyde", "alkyl halide", "enone", "other activated aryl fluoride" },
    recipe = "K2CO3, DMF, 60-80 °C; also: Et3N/DMSO, 2-nitrobenzaldehyde, ketone",
    yield = { 75, 93 },
    cautions = { "N,N-dimethylformamide" },
    source = "Joule and Mills, Heterocyclic Chemistry; from memory",
    example { "COC(=O)c1cc2cc(Br)ccc2s1", from = { "COC(=O)CS", "O=Cc1cc(Br)ccc1F" } },
    example { "COC(=O)c1cc2ccccc2s1", from = { "COC(=O)CS", "O=Cc1ccccc1F" } },
    refuse { "COC(=O)c1cccs1" }, -- a thiophene, no benzo ring
}

disconnection "benzofuran-bromoacetate" {
    about = "Benzofuran-2-carboxylate from a salicylaldehyde and a bromoacetate; O-alkylation, then aldol condensation",
    target = "[o:1]1:[c:2]([C;X3:7](=[O:8])[O:9]):[c:3]:[c;$(c1ccccc1):4]:[c;$(c1ccccc1):5]:1",
    from = "[O;H1:1]-[c:5]:[c:4]-[C:3]=O.Br[C;H2:2][C:7](=[O:8])[O:9]",
    conditions = "alkylation",
    also_attacks = { "other aldehyde" },
    recipe = "K2CO3, DMF, 80-120 °C; also: ethyl bromomalonate, Cs2CO3/MeCN",
    yield = { 65, 88 },
    cautions = { "ethyl bromoacetate", "N,N-dimethylformamide" },
    source = "Joule and Mills, Heterocyclic Chemistry; from memory",
    example { "CCOC(=O)c1cc2cc(ccc2o1)[N+](=O)[O-]", from = { "O=Cc1cc(ccc1O)[N+](=O)[O-]", "CCOC(=O)CBr" } },
    example { "CCOC(=O)c1cc2ccccc2o1", from = { "O=Cc1ccccc1O", "CCOC(=O)CBr" } },
    refuse { "CCOC(=O)c1ccco1" }, -- a furan, no benzo ring
}

disconnection "pyrrolidinone-from-butyrolactone" {
    about = "N-Substituted pyrrolidinone from butyrolactone; opens to the hydroxy amide first",
    target = "[N;X3:1]1([#6;!$([#6]=[O,S,N]):7])[C;X3:2](=[O:3])[C;X4:4][C;X4:5][C;X4;H2:6]1",
    from = "[N;H2:1][#6:7].[C:2]1(=[O:3])[C:4][C:5][C;H2:6]O1",
    conditions = "heat-200",
    also_attacks = { "ester", "acyl halide", "aldehyde", "other amine", "epoxide" },
    recipe = "neat or aq. HCl, 180-220 °C",
    yield = { 65, 88 },
    cautions = { "hydrochloric acid" },
    source = "Vogel's Textbook of Practical Organic Chemistry; from memory",
    example { "O=C1CCCN1Cc1ccc(F)cc1", from = { "NCc1ccc(F)cc1", "O=C1CCCO1" } },
    example { "CN1CCCC1=O", from = { "CN", "O=C1CCCO1" } },
    refuse { "O=C1CCCN1" }, -- no substituent on nitrogen
}

disconnection "oxopyrrolidinecarboxylic-acid" {
    about = "5-Oxopyrrolidine-3-carboxylic acid from itaconic acid and an amine; conjugate addition, then lactam; racemic",
    target = "[N;X3:1]1([#6;!$([#6]=[O,S,N]):7])[C;X3:2](=[O:3])[C;X4;H2:4][C;X4;H1:5]([C;X3:8](=[O:9])[O;H1:10])[C;X4;H2:6]1",
    from = "[N;H2:1][#6:7].O[C:2](=[O:3])[C:4][C;H0:5]([C:8](=[O:9])[O:10])=[C;H2:6]",
    conditions = "heat-200",
    also_attacks = { "aldehyde", "other primary amine", "thiol", "acyl halide" },
    recipe = "H2O or neat, 100-130 °C",
    yield = { 75, 93 },
    source = "Vogel's Textbook of Practical Organic Chemistry; from memory",
    example { "OC(=O)C1CN(C(=O)C1)c1ccc(Br)cc1", from = { "Nc1ccc(Br)cc1", "OC(=O)CC(=C)C(=O)O" } },
    example { "OC(=O)C1CN(Cc2ccccc2)C(=O)C1", from = { "NCc1ccccc1", "OC(=O)CC(=C)C(=O)O" } },
    refuse { "OC(=O)C1CNC(=O)C1" }, -- no substituent on nitrogen
}

disconnection "aryl-piperidinone-from-chlorovaleryl" {
    about = "N-Arylpiperidinone from an aniline and 5-chlorovaleryl chloride; acylation, then ring closure of the anion",
    target = "[N;X3:1]1([c:8])[C;X3:2](=[O:3])[C;X4;H2:4][C;X4;H2:5][C;X4;H2:6][C;X4;H2:7]1",
    from = "[N;H2:1][c:8].Cl[C:2](=[O:3])[C:4][C:5][C:6][C:7]Cl",
    conditions = "alkoxide",
    also_attacks = { "primary amine", "secondary amine", "free alcohol", "phenol", "thiol" },
    recipe = "Et3N, THF, 0 °C, then KOtBu or NaOH; also: 5-bromovaleryl chloride, 4-chlorobutyryl chloride for the five-ring",
    yield = { 75, 92 },
    cautions = { "sodium hydroxide", "potassium tert-butoxide", "triethylamine" },
    source = "Kleemann and Engel, Pharmaceutical Substances; from memory",
    example { "O=C1CCCCN1c1ccc(cc1)[N+](=O)[O-]", from = { "Nc1ccc(cc1)[N+](=O)[O-]", "O=C(Cl)CCCCCl" } },
    example { "O=C1CCCCN1c1ccccc1", from = { "Nc1ccccc1", "O=C(Cl)CCCCCl" } },
    refuse { "O=C1CCCCN1" }, -- no aryl group on nitrogen
}

disconnection "quinazolinedione-urea" {
    about = "Quinazoline-2,4-dione from an anthranilic acid and urea",
    target = "[nH:1]1:[c:2](=[O:3]):[nH:4]:[c:5](=[O:6]):[c;$(c1ccccc1):7]:[c;$(c1ccccc1):8]:1",
    from = "[N;H2:1]-[c:8]:[c:7]-[C:5](=[O:6])O.[N;H2:4][C:2](=[O:3])N",
    conditions = "heat-200",
    also_attacks = { "ester", "other primary amine", "free alcohol", "phenol" },
    recipe = "urea melt, 150-190 °C; also: KOCN, AcOH/H2O, then NaOH; CDI with the anthranilamide",
    yield = { 70, 90 },
    source = "Kleemann and Engel, Pharmaceutical Substances; from memory",
    example { "COc1cc2[nH]c(=O)[nH]c(=O)c2cc1OC", from = { "COc1cc(N)c(cc1OC)C(=O)O", "NC(N)=O" } },
    example { "O=c1[nH]c(=O)c2ccccc2[nH]1", from = { "Nc1ccccc1C(=O)O", "NC(N)=O" } },
    refuse { "O=c1cc[nH]c(=O)[nH]1" }, -- uracil, no benzo ring
}

disconnection "formamidine-dmf-dma" {
    about = "N-Aryl-N,N-dimethylformamidine from an aniline and DMF dimethyl acetal; E",
    target = "[c:1][N;X2:2]=[C;X3;H1:3][N;X3:4]([C;H3:5])[C;H3:6]",
    from = "[c:1][N;H2:2].CO[C;H1:3](OC)[N:4]([C:5])[C:6]",
    conditions = "heat-200",
    also_attacks = { "free acid", "phenol", "other primary amine", "primary amide", "NH azole" },
    recipe = "neat or toluene, 80-110 °C; also: DMF/POCl3",
    yield = { 85, 97 },
    source = "Kleemann and Engel, Pharmaceutical Substances; from memory",
    example { "COc1cc(N=CN(C)C)c(C#N)cc1OC", from = { "COc1cc(N)c(C#N)cc1OC", "COC(OC)N(C)C" } },
    example { "CN(C)C=Nc1ccccc1", from = { "Nc1ccccc1", "COC(OC)N(C)C" } },
    refuse { "CN(C)C(C)=NC" }, -- an acetamidine on an alkyl nitrogen
}

disconnection "anilinoquinazoline-dimroth" {
    about = "4-Anilinoquinazoline from a 2-cyanophenylformamidine and an aniline (Dimroth); rearrangement puts the aryl group on the outer nitrogen",
    target = "[n:1]1:[cH:2]:[n:3]:[c:4]([N;H1:5][c:6]):[c;$(c1ccccc1):7]:[c;$(c1ccccc1):8]:1",
    from = "[N:1](=[C;H1:2]N(C)C)-[c:8]:[c:7]-[C:4]#[N;H0:3].[N;H2:5][c:6]",
    conditions = "acid-hot-dry",
    also_attacks = { "other primary amine" },
    recipe = "AcOH, 120-130 °C",
    yield = { 75, 93 },
    cautions = { "acetic acid" },
    source = "Kleemann and Engel, Pharmaceutical Substances; from memory",
    example { "COc1cc2ncnc(Nc3cccc(Cl)c3)c2cc1OC", from = { "COc1cc(N=CN(C)C)c(C#N)cc1OC", "Nc1cccc(Cl)c1" } },
    example { "c1ccc(Nc2ncnc3ccccc23)cc1", from = { "CN(C)C=Nc1ccccc1C#N", "Nc1ccccc1" } },
    refuse { "c1ccc2c(N)ncnc2c1" }, -- no aryl group on the amine
}

disconnection "benzotriazole" {
    about = "Benzotriazole from a 1,2-phenylenediamine and nitrous acid; tautomers of one compound",
    target = "[nH:1]1:[n:5]:[n:2]:[c;$(c1ccccc1):3]:[c;$(c1ccccc1):4]:1",
    from = "[N;H2:1]-[c:4]:[c:3]-[N;H2:2].O=[N:5]O",
    conditions = "diazotisation",
    also_attacks = { "phenol" },
    recipe = "NaNO2, AcOH, H2O, 0-80 °C; also: isopentyl nitrite; mono-N-substituted diamine",
    yield = { 75, 92 },
    cautions = { "sodium nitrite" },
    source = "Vogel's Textbook of Practical Organic Chemistry; from memory",
    example { "COC(=O)c1ccc2[nH]nnc2c1", from = { "COC(=O)c1ccc(N)c(N)c1", "ON=O" } },
    example { "c1ccc2[nH]nnc2c1", from = { "Nc1ccccc1N", "ON=O" } },
    refuse { "c1c[nH]nn1" }, -- a triazole, no benzo ring
}

disconnection "benzimidazolone" {
    about = "Benzimidazol-2-one from a 1,2-phenylenediamine and CDI",
    also = { "benzimidazolone-substituted" },
    target = "[n;X3;$(n-[#6]),H1:1]1:[c:2](=[O:3]):[nH:4]:[c;$(c1ccccc1):5]:[c;$(c1ccccc1):6]:1",
    from = "[N:1]-[c:6]:[c:5]-[N:4].[C:2](=[O:3])(n1ccnc1)n1ccnc1",
    conditions = "acylation",
    recipe = "CDI, THF or MeCN, rt to 60 °C; also: triphosgene, urea melt",
    yield = { 80, 95 },
    source = "Joule and Mills, Heterocyclic Chemistry; from memory",
    example { "COC(=O)c1ccc2[nH]c(=O)[nH]c2c1", from = { "COC(=O)c1ccc(N)c(N)c1", "O=C(n1ccnc1)n1ccnc1" } },
    example { "Cn1c(=O)[nH]c2ccccc12", from = { "CNc1ccccc1N", "O=C(n1ccnc1)n1ccnc1" } },
    example { "CCOC(=O)N1CCC(CC1)n1c(=O)[nH]c2cc(Cl)ccc12",
        from = { "CCOC(=O)N1CCC(CC1)Nc1ccc(Cl)cc1N", "O=C(n1ccnc1)n1ccnc1" } },
    refuse { "O=c1[nH]cc[nH]1" }, -- an imidazolone, no benzo ring
}

disconnection "mercaptobenzimidazole" {
    about = "2-Mercaptobenzimidazole from a 1,2-phenylenediamine and carbon disulfide; thione tautomer",
    target = "[nH:1]1:[c:2](=[S:3]):[nH:4]:[c;$(c1ccccc1):5]:[c;$(c1ccccc1):6]:1",
    from = "[N;H2:1]-[c:6]:[c:5]-[N;H2:4].[C:2](=[S:3])=S",
    conditions = "base-aq-strong",
    also_attacks = { "other primary amine", "alkyl halide" },
    recipe = "KOH, EtOH/H2O, CS2, reflux; also: potassium ethyl xanthate, thiocarbonyldiimidazole",
    yield = { 75, 92 },
    cautions = { "carbon disulfide", "potassium hydroxide" },
    source = "Kleemann and Engel, Pharmaceutical Substances; from memory",
    example { "COc1ccc2[nH]c(=S)[nH]c2c1", from = { "COc1ccc(N)c(N)c1", "S=C=S" } },
    example { "S=c1[nH]c2ccccc2[nH]1", from = { "Nc1ccccc1N", "S=C=S" } },
    refuse { "S=c1[nH]cc[nH]1" }, -- an imidazolethione, no benzo ring
}

disconnection "arylpiperazine-from-mustard" {
    about = "N-Arylpiperazine from an aniline and bis(2-chloroethyl)amine",
    target = "[c:1][N;X3:2]1[C;X4;H2:3][C;X4;H2:4][N;X3;H1:5][C;X4;H2:6][C;X4;H2:7]1",
    from = "[c:1][N;H2:2].Cl[C:3][C:4][N:5][C:6][C:7]Cl",
    conditions = "amine-heat",
    also_attacks = { "other primary amine", "phenol", "thiol", "free acid" },
    recipe = "bis(2-chloroethyl)amine·HCl, xylene/hexanol or diglyme, 140-150 °C; also: K2CO3",
    yield = { 55, 85 },
    cautions = { "bis(2-chloroethyl)amine" },
    source = "Kleemann and Engel, Pharmaceutical Substances; from memory",
    example { "Clc1cccc(N2CCNCC2)c1Cl", from = { "Nc1cccc(Cl)c1Cl", "ClCCNCCCl" } },
    example { "c1ccc(cc1)N1CCNCC1", from = { "Nc1ccccc1", "ClCCNCCCl" } },
    refuse { "C1CN(CCN1)Cc1ccccc1" }, -- an N-benzyl piperazine
}

disconnection "hydroxycoumarin" {
    about = "4-Hydroxycoumarin from a 2-hydroxyacetophenone and diethyl carbonate",
    target = "[OX2H:1]-[c:2]1:[c:3]:[c:4](=[OX1:5]):[o:6]:[c;$(c1ccccc1):7]:[c;$(c1ccccc1):8]:1",
    from = "[O:1]=[C:2]([C:3])-[c:8]:[c:7]-[O:6].[C:4](=[O:5])(OCC)OCC",
    conditions = "base-hindered",
    also_attacks = { "ester", "aldehyde", "free acid", "alkyl halide" },
    recipe = "NaH or Na, toluene, 100 °C, ethanol distilled off",
    yield = { 65, 90 },
    cautions = { "sodium hydride" },
    source = "Boyd, Robertson, J. Chem. Soc. 1948, 174; from memory",
    example { "Oc1cc(=O)oc2ccccc12", from = { "CC(=O)c1ccccc1O", "CCOC(=O)OCC" } },
    example { "COc1ccc2c(O)cc(=O)oc2c1", from = { "COc1ccc(C(C)=O)c(O)c1", "CCOC(=O)OCC" } },
    refuse { "Cc1cc(=O)oc2ccccc12" }, -- no hydroxyl group at C4
}

disconnection "benzodiazepinone-glycine-ester" {
    about = "1,4-Benzodiazepin-2-one from a 2-aminobenzophenone and a glycine ester",
    target = "[NX3:1]1-[CX3:2](=[OX1:3])-[CX4:4]-[NX2:5]=[CX3:6](-[c:7])-[c:8]:[c:9]-1",
    from = "[N:1]-[c:9]:[c:8]-[C:6](=O)-[c:7].[N:5][C:4][C:2](=[O:3])OCC",
    conditions = "amine-heat",
    also_attacks = { "other primary amine", "aldehyde", "acyl halide" },
    recipe = "glycine ethyl ester hydrochloride, pyridine, reflux",
    yield = { 45, 75 },
    cautions = { "pyridine" },
    source = "Sternbach, Fryer, Metlesics, Reeder, Sach, Saucy, Stempel, J. Org. Chem. 1962, 27, 3788; from memory",
    example { "O=C1CN=C(c2ccccc2)c2cc(Cl)ccc2N1", from = { "Nc1ccc(Cl)cc1C(=O)c1ccccc1", "CCOC(=O)CN" } },
    example { "CN1C(=O)CN=C(c2ccccc2)c2cc(Cl)ccc12", from = { "CNc1ccc(Cl)cc1C(=O)c1ccccc1", "CCOC(=O)CN" } },
    refuse { "O=C1CNCc2ccccc2N1" }, -- no imine
}

disconnection "benzodiazepinone-haloacetamide" {
    about = "1,4-Benzodiazepin-2-one from a 2-(chloroacetamido)benzophenone and ammonia",
    target = "[NX3:1]1-[CX3:2](=[OX1:3])-[CX4:4]-[NX2:5]=[CX3:6](-[c:7])-[c:8]:[c:9]-1",
    from = "[N:1](-[C:2](=[O:3])-[C:4]Cl)-[c:9]:[c:8]-[C:6](=O)-[c:7].[N:5]",
    conditions = "amine-heat",
    also_attacks = { "other alkyl halide", "acyl halide", "ester" },
    recipe = "NH3, MeOH or EtOH, rt to reflux; also: hexamethylenetetramine; the bromo or iodo compound",
    yield = { 60, 85 },
    source = "Sternbach, Reeder, J. Org. Chem. 1961, 26, 4936; from memory",
    example { "CN1C(=O)CN=C(c2ccccc2)c2cc(Cl)ccc12", from = { "CN(C(=O)CCl)c1ccc(Cl)cc1C(=O)c1ccccc1", "N" } },
    example { "O=C1CN=C(c2ccccc2)c2ccccc2N1", from = { "O=C(CCl)Nc1ccccc1C(=O)c1ccccc1", "N" } },
    refuse { "O=C1CNCc2ccccc2N1" }, -- no imine
}

disconnection "bredereck-imidazole" {
    about = "Imidazole from an α-chloro ketone and formamide (Bredereck)",
    target = "[nH:1]1:[cH:2]:[n:3]:[c;R1:4](-[#6:6]):[c;R1:5]:1",
    from = "[N:1][C:2]=O.[N:3]C=O.O=[C:4](-[#6:6])[C:5]Cl",
    conditions = "heat-200",
    also_attacks = { "other alkyl halide", "acyl halide", "aldehyde" },
    recipe = "formamide (excess), 150-180 °C",
    yield = { 45, 70 },
    source = "Bredereck, Theilig, Chem. Ber. 1953, 86, 88; from memory",
    example { "c1ccc(cc1)-c1c[nH]cn1", from = { "O=C(CCl)c1ccccc1", "NC=O", "NC=O" } },
    example { "Cc1c[nH]cn1", from = { "CC(=O)CCl", "NC=O", "NC=O" } },
    refuse { "Cc1nc(C)c[nH]1" }, -- C2 substituted
}

disconnection "bredereck-imidazole-tautomer" {
    about = "Imidazole from an α-chloro ketone and formamide (Bredereck), the other tautomer",
    target = "[n:1]1:[cH:2]:[nH:3]:[c;R1:4](-[#6:6]):[c;R1:5]:1",
    from = "[N:1][C:2]=O.[N:3]C=O.O=[C:4](-[#6:6])[C:5]Cl",
    conditions = "heat-200",
    also_attacks = { "other alkyl halide", "acyl halide", "aldehyde" },
    recipe = "formamide (excess), 150-180 °C",
    yield = { 45, 70 },
    source = "Bredereck, Theilig, Chem. Ber. 1953, 86, 88; from memory",
    example { "CCOC(=O)c1nc[nH]c1C", from = { "CC(=O)C(Cl)C(=O)OCC", "NC=O", "NC=O" } },
    example { "Cc1cnc[nH]1", from = { "CC(=O)CCl", "NC=O", "NC=O" } },
    refuse { "Cc1nc(C)c[nH]1" }, -- C2 substituted
}

interconversion "pyrimidinone-from-acylamino-amide" {
    about = "Fused pyrimidin-4-one by ring closure of an ortho-acylamino carboxamide",
    target = "[nX3;H1:1]1:[c:2](-[#6:3]):[nX2:4]:[c;R2:5]:[c;R2:6]:[c:7]:1=[OX1:8]",
    from = "[N:1]-[C:7](=[O:8])-[c:6]:[c:5]-[N:4]-[C:2](=O)[#6:3]",
    conditions = "alkoxide",
    also_attacks = { "other ester", "alkyl halide", "acyl halide" },
    recipe = "KOtBu, tBuOH, or NaOH, H2O2, EtOH, reflux",
    yield = { 75, 95 },
    cautions = { "potassium tert-butoxide" },
    source = "Dale, Dunn, Golightly, Hughes, Levett, Pearce, Searle, Ward, Wood, Org. Process Res. Dev. 2000, 4, 17; from memory",
    example { "CCCc1nn(C)c2c1nc([nH]c2=O)-c1ccccc1OCC", from = { "CCCc1nn(C)c(C(N)=O)c1NC(=O)c1ccccc1OCC" } },
    example { "Cc1nc2ccccc2c(=O)[nH]1", from = { "CC(=O)Nc1ccccc1C(N)=O" } },
    refuse { "Cc1cc(=O)[nH]c(C)n1" }, -- not fused to a second ring
}

disconnection "pyrimidinone-from-amino-amide" {
    about = "Fused pyrimidin-4-one from an ortho-amino carboxamide and formamide or an orthoformate",
    target = "[nX3;H1:1]1:[cH:2]:[nX2:3]:[c;R2:4]:[c;R2:5]:[c:6]:1=[OX1:7]",
    from = "[N:1]-[C:6](=[O:7])-[c:5]:[c:4]-[N:3].[C:2](=O)N",
    conditions = "heat-200",
    also_attacks = { "other ester", "other primary amine" },
    recipe = "formamide, 160-190 °C; also: triethyl orthoformate, Ac2O; formic acid",
    yield = { 70, 92 },
    cautions = { "formamide" },
    source = "Robins, J. Am. Chem. Soc. 1956, 78, 784; from memory",
    example { "O=c1[nH]cnc2[nH]ncc12", from = { "NC(=O)c1cn[nH]c1N", "NC=O" } },
    example { "O=c1[nH]cnc2ccccc12", from = { "NC(=O)c1ccccc1N", "NC=O" } },
    refuse { "O=c1cc[nH]cn1" }, -- not fused to a second ring
}

disconnection "imidazoline-from-nitrile" {
    about = "2-Imidazoline from a nitrile and ethylenediamine",
    target = "[NX3;H1:1]1-[CX3:2](-[#6:3])=[NX2:4]-[CX4:5]-[CX4:6]-1",
    from = "[#6:3][C:2]#N.[N:1][C:6][C:5][N:4]",
    conditions = "heat-200",
    also_attacks = { "ester", "alkyl halide", "acyl halide", "ketone" },
    recipe = "ethylenediamine mono-tosylate or S8 (cat.), 120-200 °C; also: through the imidate",
    yield = { 65, 88 },
    source = "Kleemann and Engel, Pharmaceutical Substances; from memory",
    example { "C1CN=C(N1)Cc1ccccc1", from = { "N#CCc1ccccc1", "NCCN" } },
    example { "C1CN=C(N1)c1ccccc1", from = { "N#Cc1ccccc1", "NCCN" } },
    refuse { "c1c[nH]cn1" }, -- an imidazole
}

interconversion "phenothiazine" {
    about = "Phenothiazine from a diphenylamine and sulfur",
    target = "[SX2;r6]1-[c:2]:[c:3]-[NX3;H1:4]-[c:5]:[c:6]-1",
    from = "[cH:2]:[c:3]-[N:4]-[c:5]:[cH:6]",
    conditions = "heat-200",
    also_attacks = { "alkene", "aldehyde", "alcohol", "thiol" },
    recipe = "S8, I2 (cat.), 150-190 °C (hydrogen sulfide escapes)",
    yield = { 55, 85 },
    cautions = { "hydrogen sulfide" },
    source = "Massie, Chem. Rev. 1954, 54, 797; from memory",
    example { "Clc1ccc2Sc3ccccc3Nc2c1", from = { "Clc1cccc(Nc2ccccc2)c1" } },
    example { "c1ccc2Sc3ccccc3Nc2c1", from = { "c1ccc(Nc2ccccc2)cc1" } },
    refuse { "c1ccc2OCCNc2c1" }, -- a benzoxazine
}

disconnection "benzothiadiazine-dioxide" {
    about = "3,4-Dihydro-1,2,4-benzothiadiazine dioxide from a 2-aminobenzenesulfonamide and an aldehyde",
    target = "[NX3;H1:1]1-[c:2]:[c:3]-[SX4:4](=[OX1:5])(=[OX1:6])-[NX3;H1:7]-[CX4;H1,H2:8]-1",
    from = "[N:1]-[c:2]:[c:3]-[S:4](=[O:5])(=[O:6])-[N:7].[C:8]=O",
    conditions = "acid-hot-dry",
    also_attacks = { "other primary amine", "thiol" },
    recipe = "aldehyde or paraformaldehyde, cat. HCl, EtOH or diglyme, reflux",
    yield = { 70, 92 },
    cautions = { "formaldehyde" },
    source = "Kleemann and Engel, Pharmaceutical Substances; from memory",
    example { "NS(=O)(=O)c1cc2c(cc1Cl)NCNS2(=O)=O", from = { "Nc1cc(Cl)c(cc1S(N)(=O)=O)S(N)(=O)=O", "C=O" } },
    example { "CC1Nc2ccccc2S(=O)(=O)N1", from = { "Nc1ccccc1S(N)(=O)=O", "CC=O" } },
    refuse { "CC1CNS(=O)(=O)c2ccccc12" }, -- carbon where the aniline nitrogen has to be
}

interconversion "saccharin-oxidation" {
    about = "Saccharin from a 2-methylbenzenesulfonamide by oxidation of the methyl group",
    target = "[NX3;H1:1]1-[CX3:2](=[OX1])-[c:3]:[c:4]-[SX4:5]1(=[OX1:6])=[OX1:7]",
    from = "[N:1]-[S:5](=[O:6])(=[O:7])-[c:4]:[c:3]-[CH3:2]",
    conditions = "kmno4",
    also_attacks = { "alkene", "alcohol", "aldehyde", "primary amine", "other methylarene" },
    recipe = "KMnO4, aq. NaOH, 35-60 °C; also: CrO3, H2SO4; H5IO6",
    yield = { 60, 88 },
    source = "Fahlberg, Remsen, Ber. Dtsch. Chem. Ges. 1879, 12, 469; from memory",
    example { "O=C1NS(=O)(=O)c2ccccc12", from = { "Cc1ccccc1S(N)(=O)=O" } },
    refuse { "O=C1NC(=O)c2ccccc12" }, -- a phthalimide
}

interconversion "glutarimide-closure" {
    about = "Glutarimide by ring closure of a glutaramic acid",
    target = "[NX3;H1:1]1-[CX3:2](=[OX1:3])-[CX4:4]-[CX4:5]-[CX4:6]-[CX3:7]1=[OX1:8]",
    from = "[N:1][C:2](=[O:3])[C:4][C:5][C:6][C:7](=[O:8])O",
    conditions = "heat-200",
    also_attacks = { "primary amine", "alcohol", "other free acid" },
    recipe = "CDI, DMAP (cat.), MeCN or THF, reflux; also: neat, 180 °C; Ac2O",
    yield = { 70, 92 },
    source = "Kleemann and Engel, Pharmaceutical Substances; from memory",
    example { "O=C1c2ccccc2C(=O)N1C1CCC(=O)NC1=O", from = { "NC(=O)CCC(C(=O)O)N1C(=O)c2ccccc2C1=O" } },
    example { "O=C1CCCC(=O)N1", from = { "NC(=O)CCCC(=O)O" } },
    refuse { "O=C1CCC(=O)N1" }, -- a succinimide
}

disconnection "gould-jacobs-aza" {
    about = "Gould-Jacobs reaction of an aminopyridine (naphthyridinone)",
    target = "[nH1:1]1:[c;R2:2]:[c;R2;$(c1cccnc1),$(c1ccncc1),$(c1cnccc1),$(c1cccnc1):3]:[c:4](=[OX1:7]):[c;$(c-C(=O)[OX2]):5]:[cH1:6]:1",
    from = "[N:1]-[c:2]:[cH:3].CCO[C:6]=[C:5]-[C:4](=[O:7])OCC",
    conditions = "heat-200",
    also_attacks = { "other primary amine", "acetal", "tert-butyl ester" },
    recipe = "neat, 120 °C; then Ph2O, 250 °C",
    yield = { 60, 85 },
    source = "Lesher et al., J. Med. Pharm. Chem. 1962, 5, 1063; from memory",
    example { "CCOC(=O)c1c[nH]c2nc(C)ccc2c1=O", from = { "Cc1cccc(N)n1", "CCOC=C(C(=O)OCC)C(=O)OCC" } },
    refuse { "O=c1cc[nH]c2ncccc12" }, -- no ester at C3
}

disconnection "mercaptobenzimidazole-thiol" {
    about = "2-Mercaptobenzimidazole, written as the thiol, from a 1,2-phenylenediamine and carbon disulfide",
    target = "[nH:1]1:[c:2](-[SX2;H1:3]):[n:4]:[c;$(c1ccccc1):5]:[c;$(c1ccccc1):6]:1",
    from = "[N:1]-[c:6]:[c:5]-[N:4].[C:2](=[S:3])=S",
    conditions = "base-aq-strong",
    also_attacks = { "other primary amine", "alkyl halide", "acyl halide" },
    recipe = "CS2, KOH, aq. EtOH, reflux; also: potassium ethyl xanthate",
    yield = { 75, 92 },
    cautions = { "carbon disulfide" },
    source = "VanAllan, Deacon, Org. Synth. Coll. Vol. 4, 569; from memory",
    example { "COc1ccc2[nH]c(S)nc2c1", from = { "COc1ccc(N)c(N)c1", "S=C=S" } },
    example { "Sc1nc2ccccc2[nH]1", from = { "Nc1ccccc1N", "S=C=S" } },
    refuse { "Sc1ncc[nH]1" }, -- no benzo ring
}

interconversion "quinolone-decarboxylation" {
    about = "4-Quinolone by decarboxylation of the 3-carboxylic acid",
    target = "[cH;$(c1c(=O)c2aaaac2[nH]c1):1]",
    from = "[c:1]C(=O)O",
    conditions = "heat-200",
    also_attacks = { "tert-butyl ester", "Boc carbamate" },
    recipe = "Ph2O or paraffin, 240-260 °C; copper chromite",
    yield = { 80, 95 },
    source = "Price, Roberts, Org. Synth. Coll. Vol. 3, 272; from memory",
    example { "O=c1cc[nH]c2cc(Cl)ccc12", from = { "OC(=O)c1c[nH]c2cc(Cl)ccc2c1=O" } },
    example { "O=c1cc[nH]c2ccccc12", from = { "OC(=O)c1c[nH]c2ccccc2c1=O" } },
    refuse { "c1ccc2ncccc2c1" }, -- no oxo group
}

disconnection "pyrazolidinedione" {
    about = "Pyrazolidine-3,5-dione from a malonate and a 1,2-diarylhydrazine",
    target = "[NX3:1]1(-[c:6])-[NX3:2](-[c:7])-[CX3:3](=[OX1:8])-[CX4:4]-[CX3:5]1=[OX1:9]",
    from = "[N:1](-[c:6])-[N:2]-[c:7].CCO[C:3](=[O:8])[C:4][C:5](=[O:9])OCC",
    conditions = "alkoxide",
    also_attacks = { "other ester", "aldehyde", "alkyl halide", "acyl halide" },
    recipe = "NaOEt, xylene, 130-150 °C, ethanol distilled off; also: malonyl chloride, pyridine",
    yield = { 55, 80 },
    cautions = { "sodium ethoxide" },
    source = "Kleemann and Engel, Pharmaceutical Substances; from memory",
    example { "CCCCC1C(=O)N(c2ccccc2)N(c2ccccc2)C1=O",
        from = { "c1ccc(NNc2ccccc2)cc1", "CCCCC(C(=O)OCC)C(=O)OCC" } },
    example { "O=C1CC(=O)N(c2ccccc2)N1c1ccccc1", from = { "c1ccc(NNc2ccccc2)cc1", "CCOC(=O)CC(=O)OCC" } },
    refuse { "O=C1CCNN1" }, -- one carbonyl group only
}

disconnection "phthalazinone" {
    about = "Phthalazin-1-one from a 2-acylbenzoic acid and hydrazine",
    target = "[nH:1]1:[n:2]:[c:3]:[c;$(c1ccccc1):4]:[c;$(c1ccccc1):5]:[c:6]1=[OX1:7]",
    from = "[N:1][N:2].O=[C:3]-[c:4]:[c:5]-[C:6](=[O:7])O",
    conditions = "hydrazine",
    also_attacks = { "other ketone", "other ester", "acyl halide" },
    recipe = "N2H4·H2O, EtOH or AcOH, reflux",
    yield = { 80, 96 },
    cautions = { "hydrazine" },
    source = "Joule, Mills, Heterocyclic Chemistry; from memory",
    example { "O=c1[nH]ncc2ccccc12", from = { "NN", "O=Cc1ccccc1C(=O)O" } },
    example { "O=c1[nH]nc(c2ccccc12)-c1ccccc1", from = { "NN", "O=C(O)c1ccccc1C(=O)c1ccccc1" } },
    refuse { "O=c1cccn[nH]1" }, -- no benzo ring
}

disconnection "pyrrolidinone-from-chlorobutyryl" {
    about = "N-Substituted pyrrolidinone from a primary amine or amide and 4-chlorobutyryl chloride",
    target = "[NX3:1]1(-[CX4,c:2])-[CX3:3](=[OX1:4])-[CX4;H2:5]-[CX4;H2:6]-[CX4;H2:7]-1",
    from = "[N:1]-[#6:2].Cl[C:3](=[O:4])[C:5][C:6][C:7]Cl",
    conditions = "alkoxide",
    also_attacks = { "other primary amine", "alcohol", "phenol", "thiol", "other alkyl halide" },
    recipe = "Et3N or KOH, CH2Cl2, 0 °C; then KOH, Bu4NBr, or KOtBu",
    yield = { 65, 90 },
    source = "Kleemann and Engel, Pharmaceutical Substances; from memory",
    example { "CCC(C(N)=O)N1CCCC1=O", from = { "CCC(N)C(N)=O", "O=C(Cl)CCCCl" } },
    example { "O=C1CCCN1c1ccccc1", from = { "Nc1ccccc1", "O=C(Cl)CCCCl" } },
    refuse { "O=C1CCCN1" }, -- nothing on nitrogen
}

disconnection "friedlaender-nitrile" {
    about = "4-Aminoquinoline from a 2-aminobenzonitrile and a ketone (tacrine)",
    target = "[nX2:1]1:[c;$(c1ccccc1):2]:[c;$(c1ccccc1):3]:[c:4](-[NX3;H2:7]):[c:5]:[c;$(c-[#6]):6]:1",
    from = "[N:1]-[c:2]:[c:3]-[C:4]#[N:7].[C:5]-[C:6]=O",
    conditions = "lewis-acid",
    also_attacks = { "acetal", "alcohol", "other ketone", "aldehyde" },
    recipe = "ZnCl2, neat, 120 °C, or BF3·OEt2, toluene, reflux",
    yield = { 60, 88 },
    cautions = { "zinc chloride" },
    source = "Kleemann and Engel, Pharmaceutical Substances; from memory",
    example { "Nc1c2CCCCc2nc2ccccc12", from = { "Nc1ccccc1C#N", "O=C1CCCCC1" } },
    example { "Nc1c2CCCc2nc2ccccc12", from = { "Nc1ccccc1C#N", "O=C1CCCC1" } },
    refuse { "Nc1ccnc2ccccc12" }, -- nothing at C2
}

disconnection "thiazolidinedione" {
    about = "Thiazolidine-2,4-dione from chloroacetic acid and thiourea",
    target = "[NX3;H1:1]1-[CX3:2](=[OX1:3])-[CX4;H2,H1:4]-[SX2:5]-[CX3:6]1=[OX1]",
    from = "[N:1]-[C:6](=[S:5])N.[O:3]=[C:2](O)[C:4]Cl",
    conditions = "acid-aq-strong",
    also_attacks = { "ester", "nitrile", "acetal", "Boc carbamate" },
    recipe = "water, conc. HCl, reflux",
    yield = { 75, 92 },
    cautions = { "chloroacetic acid" },
    source = "Kleemann and Engel, Pharmaceutical Substances; from memory",
    example { "O=C1CSC(=O)N1", from = { "NC(N)=S", "OC(=O)CCl" } },
    refuse { "O=C1CSCN1" }, -- one carbonyl group only
}

interconversion "azinone-thionation" {
    about = "Thionation of an azinone or purinone (oxo NH form) with phosphorus pentasulfide",
    target = "[c:1](=[SX1:2]):[nH:3]",
    from = "[c:1](=O):[nH:3]",
    conditions = "heat-200",
    also_attacks = { "ketone", "amide", "alcohol", "ester", "aldehyde" },
    recipe = "P4S10, pyridine or dioxane, reflux; also: Lawesson reagent",
    yield = { 65, 92 },
    cautions = { "phosphorus pentasulfide" },
    source = "Elion, Burgi, Hitchings, J. Am. Chem. Soc. 1952, 74, 411; from memory",
    example { "S=c1[nH]cnc2[nH]cnc12", from = { "O=c1[nH]cnc2[nH]cnc12" } },
    example { "S=c1cccc[nH]1", from = { "O=c1cccc[nH]1" } },
    refuse { "Sc1ccccc1" }, -- no ring nitrogen
}
