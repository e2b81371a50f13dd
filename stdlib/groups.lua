-- Functional groups: how they are recognised, and which are narrower kinds of which.
--
-- A hit of a wider group counts for nothing where a narrower one covers all its atoms: a tert-butyl ester is no plain
-- ester, an enone no ketone and no alkene. What a class of conditions does to a wider group holds for the narrower ones,
-- too, unless `conditions` say otherwise. A group without parents adds a worry and hides none.
--
-- The patterns are textbook knowledge, from memory. Each of `examples` is a molecule with one hit, or { molecule, hits };
-- `non_examples` are near misses. `also` are other words for the group, among them those of `spares` and `also_attacks`.

pack {
    name = "groups",
    version = "0.1.0",
    licence = "CC0-1.0",
    about = "Functional groups and how they are recognised",
}

group "amine" {
    smarts = "[NX3;+0;!$(N~[!#6;!#1]);!$(N[CX3]=[O,S,N,C]);!$(NC#N)]",
    examples = { "CCN", "CNC", "CN(C)C", "Nc1ccccc1", { "NCCN", 2 } },
    non_examples = { "CC(N)=O", "CS(N)(=O)=O", "NC(N)=N", "c1ccncc1", "NN" },
}

group "primary-amine" {
    name = "primary alkylamine",
    smarts = "[NX3;H2;+0;$(N[CX4])]",
    parents = { "amine" },
    examples = { "CCCN", "NC1CCCCC1", "NCc1ccccc1", { "NCCN", 2 } },
    non_examples = { "CC(N)=O", "Nc1ccccc1", "CNC", "NN", "CS(N)(=O)=O" },
}

group "secondary-amine" {
    name = "secondary alkylamine",
    smarts = "[NX3;H1;+0;$(N([CX4])[CX4])]",
    parents = { "amine" },
    examples = { "CNC", "C1CCNCC1", "CNCc1ccccc1", { "C1CNCCN1", 2 } },
    non_examples = { "CNC(C)=O", "CNc1ccccc1", "CN(C)C", "c1cc[nH]c1" },
}

group "tertiary-amine" {
    name = "tertiary alkylamine",
    smarts = "[NX3;H0;+0;$(N([CX4])([CX4])[CX4])]",
    parents = { "amine" },
    examples = { "CCN(CC)CC", "CN1CCCC1", { "C1CN2CCN1CC2", 2 } },
    non_examples = { "CN(C)C=O", "CN(C)c1ccccc1", "C[N+](C)(C)C", "CN(C)S(C)(=O)=O" },
}

group "n-benzyl-amine" {
    name = "N-benzylamine (secondary or tertiary)",
    smarts = "[NX3;+0;!$(N~[!#6;!#1]);!$(N[CX3]=[O,S,N,C]);!$(NC#N);!H2][CX4;H2;$(Cc1ccccc1)]",
    parents = { "amine" },
    examples = { "CNCc1ccccc1", "C(N1CCCC1)c1ccccc1", { "C(NCc1ccccc1)c1ccccc1", 2 } },
    non_examples = { "NCc1ccccc1", "CC(=O)NCc1ccccc1", "NCCc1ccccc1" },
}

group "aniline" {
    name = "arylamine",
    smarts = "[NX3;+0;!$(N~[!#6;!#1]);!$(N[CX3]=[O,S,N,C]);!$(NC#N);$(Nc)]",
    parents = { "amine" },
    examples = { "Nc1ccccc1", "CNc1ccccc1", "CN(C)c1ccccc1", "Nc1ccccn1" },
    non_examples = { "CC(=O)Nc1ccccc1", "NCc1ccccc1", "CS(=O)(=O)Nc1ccccc1", "O=[N+]([O-])c1ccccc1" },
}

group "primary-aniline" {
    name = "primary arylamine",
    smarts = "[NX3;H2;+0;$(Nc)]",
    parents = { "aniline" },
    examples = { "Nc1ccccc1", { "Nc1ccc(N)cc1", 2 }, "COc1ccc(N)cc1" },
    non_examples = { "CNc1ccccc1", "NCc1ccccc1", "CC(=O)Nc1ccccc1" },
}

group "secondary-aniline" {
    name = "secondary arylamine",
    smarts = "[NX3;+0;!$(N~[!#6;!#1]);!$(N[CX3]=[O,S,N,C]);!$(NC#N);H1;$(Nc)]",
    parents = { "aniline" },
    examples = { "CNc1ccccc1", "c1ccc(Nc2ccccc2)cc1", "C1CCc2ccccc2N1" },
    non_examples = { "Nc1ccccc1", "CN(C)c1ccccc1", "CC(=O)Nc1ccccc1", "c1ccc2[nH]ccc2c1" },
}

group "tertiary-aniline" {
    name = "tertiary arylamine",
    smarts = "[NX3;+0;!$(N~[!#6;!#1]);!$(N[CX3]=[O,S,N,C]);!$(NC#N);H0;$(Nc)]",
    parents = { "aniline" },
    examples = { "CN(C)c1ccccc1", "c1ccc(N2CCOCC2)cc1", "CCN(CC)c1ccc(C=O)cc1" },
    non_examples = { "CNc1ccccc1", "CN(C(C)=O)c1ccccc1", "C[N+](C)(C)c1ccccc1" },
}

group "amide" {
    name = "carboxamide",
    smarts = "[NX3;+0;!$(N([CX3]=[OX1])[CX3]=[OX1]);!$(N[#7]);!$(NS(=O)=O)][CX3;$(C[#6]),$([CX3;H1])]=[OX1]",
    examples = { "CC(N)=O", "CNC(C)=O", "CN(C)C=O", "O=C1CCCN1" },
    non_examples = { "CC(=O)OC", "NC(N)=O", "COC(N)=O", "O=C1CCC(=O)N1", "NC(C)=N" },
}

group "primary-amide" {
    name = "primary amide",
    smarts = "[NX3;H2;+0][CX3;$(C[#6]),$([CX3;H1])]=[OX1]",
    parents = { "amide" },
    examples = { "CC(N)=O", "NC(=O)c1ccccc1", { "NC(=O)CCC(N)=O", 2 } },
    non_examples = { "CNC(C)=O", "NC(N)=O", "COC(N)=O", "CCN" },
}

group "secondary-amide" {
    name = "secondary amide",
    smarts = "[NX3;H1;+0;$(N([CX3]=[OX1])[#6]);!$(N([CX3]=[OX1])[CX3]=[OX1])][CX3;$(C[#6]),$([CX3;H1])]=[OX1]",
    parents = { "amide" },
    examples = { "CNC(C)=O", "CC(=O)Nc1ccccc1", "O=C1CCCN1", { "CNC(=O)CCC(=O)NC", 2 } },
    non_examples = { "CC(N)=O", "CN(C)C=O", "CNC(=O)OC", "O=C1CCC(=O)N1" },
}

group "tertiary-amide" {
    name = "tertiary amide",
    smarts = "[NX3;H0;+0;!$(N([CX3]=[OX1])[CX3]=[OX1]);!$(N[!#6])][CX3;$(C[#6]),$([CX3;H1])]=[OX1]",
    parents = { "amide" },
    examples = { "CN(C)C(C)=O", "O=C(c1ccccc1)N1CCCC1", "CN1CCCC1=O" },
    non_examples = { "CNC(C)=O", "CN(C)C(=O)OC", "CN(C)CC", "CON(C)C(C)=O" },
}

group "weinreb-amide" {
    name = "N-methoxy-N-methylamide",
    smarts = "[NX3;+0]([CH3])([OX2][CH3])[CX3;$(C[#6])]=[OX1]",
    parents = { "amide" },
    examples = { "CON(C)C(C)=O", "CON(C)C(=O)c1ccccc1", "CON(C)C(=O)CCC(C)C" },
    non_examples = { "CN(C)C(C)=O", "CONC(C)=O", "CON(C)CC" },
}

group "lactam" {
    smarts = "[NX3;+0;R;!$(N([CX3]=[OX1])[CX3]=[OX1])]@[CX3;R;$(C[#6])]=[OX1]",
    parents = { "amide" },
    examples = { "O=C1CCCN1", "CN1CCCCC1=O", "O=C1CC2CCCC2N1" },
    non_examples = { "CNC(C)=O", "O=C1CCC(=O)N1", "CC(=O)N1CCCC1", "O=C1CCCO1" },
}

group "beta-lactam" {
    smarts = "[NX3;+0;r4]@[CX3;r4]=[OX1]",
    parents = { "lactam" },
    examples = { "O=C1CCN1", "O=C1C(c2ccccc2)C(C)N1c1ccccc1", "O=C1CC2SC(C)(C)CN12" },
    non_examples = { "O=C1CCCN1", "C1CNC1", "O=C1CCO1" },
}

group "trifluoroacetamide" {
    smarts = "FC(F)(F)[CX3](=[OX1])[NX3;+0]",
    parents = { "amide" },
    examples = { "O=C(NCC)C(F)(F)F", "CN(C)C(=O)C(F)(F)F", "O=C(Nc1ccccc1)C(F)(F)F" },
    non_examples = { "CNC(C)=O", "O=C(OCC)C(F)(F)F", "FC(F)(F)CNC(C)=O" },
}

group "carbamate" {
    smarts = "[NX3;+0][CX3](=[OX1])[OX2;H0][#6]",
    examples = { "COC(=O)NC", "CCOC(=O)N1CCCC1", "CC(C)(C)OC(=O)NC" },
    non_examples = { "NC(N)=O", "CNC(C)=O", "COC(=O)OC", "COC(C)=O" },
}

group "carbamate-nh" {
    name = "N-H of a carbamate",
    smarts = "[NX3;+0;!H0][CX3](=[OX1])[OX2;H0][#6]",
    examples = { "COC(=O)NC", "CC(C)(C)OC(=O)NC", "COC(N)=O", "O=C1NCCO1" },
    non_examples = { "CCOC(=O)N1CCCC1", "CNC(C)=O", "CNC(=O)NC", "NC(O)=O" },
}

group "boc-amine" {
    name = "Boc amine",
    smarts = "[NX3;+0][CX3](=[OX1])[OX2]C([CH3])([CH3])[CH3]",
    parents = { "carbamate" },
    also = { "Boc carbamate", "Boc amine", "Boc group" },
    examples = {
        "CC(C)(C)OC(=O)NC", "CC(C)(C)OC(=O)N1CCCC1", "CC(C)(C)OC(=O)Nc1ccccc1",
        { "CC(C)(C)OC(=O)NCCNC(=O)OC(C)(C)C", 2 },
    },
    non_examples = { "CC(C)(C)OC(C)=O", "COC(=O)NC", "CC(C)(C)NC(C)=O", "CC(C)(C)OC(=O)OC" },
}

group "cbz-amine" {
    name = "Cbz amine",
    smarts = "[NX3;+0][CX3](=[OX1])[OX2][CX4;H2]c1ccccc1",
    parents = { "carbamate" },
    also = { "Cbz carbamate", "Cbz amine" },
    examples = { "CNC(=O)OCc1ccccc1", "O=C(OCc1ccccc1)N1CCCC1", "OC(=O)CNC(=O)OCc1ccccc1" },
    non_examples = { "CC(=O)OCc1ccccc1", "CNC(=O)OC", "COCc1ccccc1", "CNC(=O)Cc1ccccc1" },
}

group "fmoc-amine" {
    name = "Fmoc amine",
    smarts = "[NX3;+0][CX3](=[OX1])[OX2][CX4;H2][CX4;H1]1c2ccccc2-c2ccccc12",
    parents = { "carbamate" },
    also = { "Fmoc carbamate", "Fmoc amine" },
    examples = {
        "CNC(=O)OCC1c2ccccc2-c2ccccc21", "O=C(OCC1c2ccccc2-c2ccccc21)N1CCCC1", "OC(=O)CNC(=O)OCC1c2ccccc2-c2ccccc21",
    },
    non_examples = { "CNC(=O)OCc1ccccc1", "CNC(=O)OC", "OCC1c2ccccc2-c2ccccc21" },
}

group "alloc-amine" {
    name = "Alloc amine",
    smarts = "[NX3;+0][CX3](=[OX1])[OX2][CX4;H2][CX3;H1]=[CX3;H2]",
    parents = { "carbamate" },
    examples = { "C=CCOC(=O)NC", "C=CCOC(=O)N1CCCC1", "C=CCOC(=O)Nc1ccccc1" },
    non_examples = { "C=CCOC(C)=O", "CCCOC(=O)NC", "C=CCNC(=O)OC" },
}

group "urea" {
    smarts = "[NX3;+0][CX3](=[OX1])[NX3;+0]",
    examples = { "NC(N)=O", "CNC(=O)NC", "O=C1NCCN1", "O=C(Nc1ccccc1)N1CCCC1" },
    non_examples = { "CNC(C)=O", "CNC(=O)OC", "NC(N)=N", "NC(N)=S" },
}

group "imide" {
    smarts = "[CX3;$(C[#6])](=[OX1])[NX3;+0][CX3;$(C[#6])]=[OX1]",
    examples = { "O=C1CCC(=O)N1", "CN1C(=O)CCC1=O", "CC(=O)NC(C)=O", "CN1C(=O)c2ccccc2C1=O" },
    non_examples = { "CNC(C)=O", "CC(=O)OC(C)=O", "CNC(=O)NC", "CC(=O)CC(C)=O" },
}

group "phthalimide" {
    smarts = "[CX3]1(=[OX1])[NX3;+0][CX3](=[OX1])c2ccccc12",
    parents = { "imide" },
    examples = { "CN1C(=O)c2ccccc2C1=O", "O=C1NC(=O)c2ccccc12", "O=C1N(CCCBr)C(=O)c2ccccc12" },
    non_examples = { "O=C1CCC(=O)N1", "O=C1NCc2ccccc12", "O=C1OC(=O)c2ccccc12" },
}

group "sulfonamide" {
    smarts = "[NX3;+0][SX4;$(S[#6])](=[OX1])=[OX1]",
    examples = { "CS(N)(=O)=O", "CNS(=O)(=O)c1ccccc1", "Cc1ccc(cc1)S(=O)(=O)N1CCCC1" },
    non_examples = { "CS(C)(=O)=O", "CS(=O)(=O)OC", "CS(N)=O", "CC(N)=O" },
}

group "sulfonamide-nh" {
    name = "N-H of a sulfonamide",
    smarts = "[NX3;+0;!H0][SX4;$(S[#6])](=[OX1])=[OX1]",
    examples = { "CS(N)(=O)=O", "CNS(=O)(=O)c1ccccc1", "Cc1ccc(cc1)S(=O)(=O)NC" },
    non_examples = { "CN(C)S(C)(=O)=O", "CC(N)=O", "CNS(C)=O", "Cc1ccc(cc1)S(=O)(=O)N1CCCC1" },
}

group "tosylamide" {
    name = "p-toluenesulfonamide",
    smarts = "[NX3;+0][SX4](=[OX1])(=[OX1])c1ccc([CH3])cc1",
    parents = { "sulfonamide" },
    examples = { "Cc1ccc(cc1)S(=O)(=O)NC", "Cc1ccc(cc1)S(N)(=O)=O", "Cc1ccc(cc1)S(=O)(=O)N1CCCC1" },
    non_examples = { "CNS(C)(=O)=O", "Cc1ccc(cc1)S(=O)(=O)OC", "CNS(=O)(=O)c1ccccc1", "Cc1ccc(cc1)S(C)(=O)=O" },
}

group "nosylamide" {
    name = "nitrobenzenesulfonamide",
    smarts = "[NX3;+0][SX4](=[OX1])(=[OX1])[c;$(c1c([N+](=O)[O-])cccc1),$(c1ccc([N+](=O)[O-])cc1)]",
    parents = { "sulfonamide" },
    examples = {
        "CNS(=O)(=O)c1ccccc1[N+](=O)[O-]", "CNS(=O)(=O)c1ccc(cc1)[N+](=O)[O-]", "O=[N+]([O-])c1ccccc1S(=O)(=O)N1CCCC1",
    },
    non_examples = { "CNS(=O)(=O)c1ccccc1", "CNS(=O)(=O)c1cccc(c1)[N+](=O)[O-]", "COS(=O)(=O)c1ccccc1[N+](=O)[O-]" },
}

group "nitrile" {
    smarts = "[CX2;$(C[#6])]#[NX1]",
    examples = { "CC#N", "N#Cc1ccccc1", { "N#CCCC#N", 2 } },
    non_examples = { "[C-]#N", "C[N+]#[C-]", "CC#C", "CC=N" },
}

group "isonitrile" {
    smarts = "[NX2;+]#[CX1;-]",
    also = { "isocyanide" },
    examples = { "C[N+]#[C-]", "[C-]#[N+]c1ccccc1", "COC(=O)C[N+]#[C-]" },
    non_examples = { "CC#N", "CN=C=O", "C[N+](=O)[O-]" },
}

group "isocyanate" {
    smarts = "[NX2;$(N[#6])]=[CX2]=[OX1]",
    examples = { "CN=C=O", "O=C=Nc1ccccc1", { "O=C=NCCCN=C=O", 2 } },
    non_examples = { "CN=C=S", "CC(N)=O", "CN=CC", "C=C=O" },
}

group "nitro" {
    smarts = "[NX3;+;$(N[#6])](=[OX1])[OX1;-]",
    also = { "nitro group" },
    examples = { "C[N+](=O)[O-]", "O=[N+]([O-])c1ccccc1", { "O=[N+]([O-])c1cccc(c1)[N+](=O)[O-]", 2 } },
    non_examples = { "CO[N+](=O)[O-]", "CN=O", "C[N+](C)(C)[O-]", "[O-][n+]1ccccc1" },
}

group "aryl-nitro" {
    name = "nitroarene",
    smarts = "[NX3;+;$(Nc)](=[OX1])[OX1;-]",
    parents = { "nitro" },
    examples = { "O=[N+]([O-])c1ccccc1", "Cc1ccc(cc1)[N+](=O)[O-]", { "O=[N+]([O-])c1cccc(c1)[N+](=O)[O-]", 2 } },
    non_examples = { "C[N+](=O)[O-]", "O=Nc1ccccc1", "[O-][n+]1ccccc1" },
}

group "alkyl-nitro" {
    name = "nitroalkane",
    smarts = "[NX3;+;$(N[CX4])](=[OX1])[OX1;-]",
    parents = { "nitro" },
    examples = { "C[N+](=O)[O-]", "CC(C)[N+](=O)[O-]", "O=[N+]([O-])CCc1ccccc1" },
    non_examples = { "O=[N+]([O-])c1ccccc1", "CO[N+](=O)[O-]", "C=C[N+](=O)[O-]" },
}

group "azide" {
    smarts = "[NX2;$(N[#6])]~[NX2;+]~[NX1]",
    examples = { "CCN=[N+]=[N-]", "[N-]=[N+]=Nc1ccccc1", { "[N-]=[N+]=NCCCN=[N+]=[N-]", 2 } },
    non_examples = { "[N-]=[N+]=C", "c1ccc(cc1)[N+]#N", "[N-]=[N+]=[N-]", "CN=NC" },
}

group "diazo" {
    name = "diazo compound",
    smarts = "[CX3]=[NX2;+]=[NX1;-]",
    examples = { "C=[N+]=[N-]", "CCOC(=O)C=[N+]=[N-]", "[N-]=[N+]=C(C(=O)OC)C(=O)OC" },
    non_examples = { "CN=[N+]=[N-]", "N#[N+]c1ccccc1", "CN=NC" },
}

group "hydrazine" {
    name = "hydrazine, hydrazide",
    smarts = "[NX3;+0;!$(N[CX3]=[O,S,N])][NX3;+0]",
    examples = { "CNN", "NNc1ccccc1", "CC(=O)NN", "CN(C)N" },
    non_examples = { "CC=NN", "CCN", "NC(N)=O", "NO" },
}

group "hydrazone" {
    smarts = "[CX3;!$(C[#7,#8,#16])]=[NX2;+0][NX3;+0]",
    examples = { "CC=NN", "CC(C)=NNc1ccccc1", "CC(C)=NNS(=O)(=O)c1ccc(C)cc1" },
    non_examples = { "CC=NO", "CNN", "CC=NC", "CC=NN=CC" },
}

group "oxime" {
    name = "oxime, oxime ether",
    smarts = "[CX3;!$(C[#7,#8,#16])]=[NX2;+0][OX2]",
    examples = { "CC=NO", "CC(C)=NOC", "ON=C1CCCCC1" },
    non_examples = { "CC=NC", "CC=NN", "CC(=O)NO", "CN=O" },
}

group "imine" {
    smarts = "[CX3;!$(C[#7,#8,#16,F,Cl,Br,I])]=[NX2;+0;!$(N[!#6;!#1])]",
    examples = { "CC(C)=NC", "C(=Nc1ccccc1)c1ccccc1", "N=C(c1ccccc1)c1ccccc1", "C1CCC=N1" },
    non_examples = { "CC=NO", "CC(N)=NC", "c1ccncc1", "CC#N", "CC=NN" },
}

group "enamine" {
    smarts = "[NX3;+0;!$(N~[!#6;!#1]);!$(N[CX3]=[O,S,N])][CX3;!$(C=CC=[OX1]);!$(C=CC#N)]=[CX3]",
    examples = { "CN(C)C=C", "C1CCC(=CC1)N1CCCC1", "CC=CN1CCOCC1" },
    non_examples = { "CC(=O)NC=C", "CN(C)C=CC(C)=O", "c1cc[nH]c1", "CN(C)CC=C" },
}

group "n-oxide" {
    name = "amine or pyridine N-oxide",
    smarts = "[$([nX3;+]),$([NX4;+])][OX1;-]",
    examples = { "C[N+](C)(C)[O-]", "[O-][n+]1ccccc1", "C[N+]1([O-])CCOCC1" },
    non_examples = { "C[N+](=O)[O-]", "c1ccncc1", "CN(C)O", "C[n+]1ccccc1" },
}

group "quaternary-ammonium" {
    name = "quaternary ammonium",
    smarts = "[NX4;+;H0;!$(N[O-])]",
    examples = { "C[N+](C)(C)C", "C[N+](C)(C)Cc1ccccc1", "CC[N+]1(C)CCCCC1" },
    non_examples = { "CN(C)C", "C[NH+](C)C", "C[N+](C)(C)[O-]", "C[n+]1ccccc1" },
}

group "alcohol" {
    smarts = "[OX2;H1][CX4;!$(C([OX2;H1])[#7,#8,#16,F,Cl,Br,I])]",
    also = { "free alcohol" },
    examples = { "CO", "CCO", "CC(C)O", "CC(C)(C)O", { "OCCO", 2 } },
    non_examples = { "Oc1ccccc1", "CC(O)=O", "COC", "OC1CCCCO1" },
}

group "primary-alcohol" {
    name = "primary alcohol",
    smarts = "[OX2;H1][CX4;H2;$(C[#6])]",
    parents = { "alcohol" },
    examples = { "CCO", "OCc1ccccc1", { "OCCO", 2 }, "CC(C)CO" },
    non_examples = { "CC(C)O", "CO", "COCO", "Oc1ccccc1" },
}

group "secondary-alcohol" {
    name = "secondary alcohol",
    smarts = "[OX2;H1][CX4;H1;$(C([#6])[#6])]",
    parents = { "alcohol" },
    examples = { "CC(C)O", "OC1CCCCC1", "CC(O)c1ccccc1", { "CC(O)CC(C)O", 2 } },
    non_examples = { "CCO", "CC(C)(C)O", "OC1CCCCO1", "CC(O)OC" },
}

group "tertiary-alcohol" {
    name = "tertiary alcohol",
    smarts = "[OX2;H1][CX4;H0;$(C([#6])([#6])[#6])]",
    parents = { "alcohol" },
    examples = { "CC(C)(C)O", "CC1(O)CCCCC1", "CC(O)(c1ccccc1)c1ccccc1" },
    non_examples = { "CC(C)O", "CC(C)(O)OC", "CC(C)(C)OC", "Oc1ccccc1" },
}

group "benzylic-alcohol" {
    name = "benzylic alcohol with carbinol H",
    smarts = "[OX2;H1][CX4;!H0;$(Cc);!$(C([OX2;H1])[#7,#8,#16,F,Cl,Br,I])]",
    parents = { "alcohol" },
    examples = { "OCc1ccccc1", "CC(O)c1ccccc1", { "OCc1ccc(CO)cc1", 2 } },
    non_examples = { "OCCc1ccccc1", "CC(C)(O)c1ccccc1", "Oc1ccccc1", "COCc1ccccc1" },
}

group "allylic-alcohol" {
    name = "allylic alcohol with carbinol H",
    smarts = "[OX2;H1][CX4;!H0;$(C[CX3]=[CX3]);!$(C([OX2;H1])[#7,#8,#16,F,Cl,Br,I])]",
    parents = { "alcohol" },
    examples = { "C=CCO", "CC(O)C=C", "OC1CCCC=C1", "CC(C)=CCO" },
    non_examples = { "C=CCCO", "OCc1ccccc1", "C=CC(C)(C)O", "C=CCOC" },
}

group "vicinal-diol" {
    name = "1,2-diol",
    smarts = "[OX2;H1][CX4;!$(C([OX2;H1])[#7,#8,#16,F,Cl,Br,I])][CX4;!$(C([OX2;H1])[#7,#8,#16,F,Cl,Br,I])][OX2;H1]",
    parents = { "alcohol" },
    also = { "1", "2-diol" },
    examples = { "OCCO", "OC1CCCCC1O", "OCC(O)c1ccccc1", { "OCC(O)CO", 2 } },
    non_examples = { "OCCCO", "COCCO", "Oc1ccccc1O", "NCCO" },
}

group "phenol" {
    smarts = "[OX2;H1]c",
    also = { "electron-rich phenol" },
    examples = { "Oc1ccccc1", { "Oc1ccc(O)cc1", 2 }, "Oc1cccc2ccccc12", "Oc1cccnc1" },
    non_examples = { "OCc1ccccc1", "COc1ccccc1", "OC1CCCCC1", "Sc1ccccc1" },
}

group "hydroquinone" {
    name = "hydroquinone or catechol",
    smarts = "[OX2;H1;$(Oc:c[OX2;H1]),$(Oc1:c:c:c([OX2;H1]):c:c:1)]c",
    parents = { "phenol" },
    examples = { { "Oc1ccc(O)cc1", 2 }, { "Oc1ccccc1O", 2 }, { "CCc1ccc(O)c(O)c1", 2 } },
    non_examples = { "Oc1cccc(O)c1", "COc1ccc(O)cc1", "Oc1ccccc1" },
}

group "thiol" {
    smarts = "[SX2;H1][#6]",
    examples = { "CCS", "Sc1ccccc1", { "SCCS", 2 }, "NC(CS)C(O)=O" },
    non_examples = { "CSC", "CSSC", "CO", "CC(O)=S" },
}

group "disulfide" {
    smarts = "[SX2;$(S[#6])][SX2;$(S[#6])]",
    examples = { "CSSC", "C1CCSS1", "c1ccc(SSc2ccccc2)cc1" },
    non_examples = { "CSC", "CS", "SCCS", "COOC" },
}

group "thioether" {
    name = "sulfide",
    smarts = "[SX2;H0;$(S([#6])[#6]);!$(S[CX3]=[O,S,N]);!$(SC#N)]",
    also = { "sulfide" },
    examples = { "CSC", "CSc1ccccc1", "C1CCSC1", { "C1CSCCS1", 2 } },
    non_examples = { "CS", "CSSC", "CC(=O)SC", "c1ccsc1", "CS(C)=O" },
}

group "thioester" {
    smarts = "[CX3;$(C[#6]),$([CX3;H1])](=[OX1])[SX2;H0][#6]",
    examples = { "CC(=O)SC", "CCSC(=O)c1ccccc1", "CC(=O)SCC(C)C" },
    non_examples = { "CC(=O)OC", "CC(=O)S", "CSC", "CC(=S)OC" },
}

group "dithioacetal" {
    smarts = "[SX2;H0;$(S([#6])[#6])][CX4;!$(C([SX2])([SX2])[SX2])][SX2;H0;$(S([#6])[#6])]",
    parents = { "thioether" },
    examples = { "C1CSCSC1", "CCSC(C)SCC", "C1CCC2(CC1)SCCCS2" },
    non_examples = { "CSCCSC", "COCSC", "COC(C)OC", "CSC" },
}

group "ether" {
    name = "ether (alkyl or aryl alkyl)",
    smarts = "[OX2;H0;$(O([#6])[CX4]);!$(O[CX3]);!$(O[CX4][OX2,SX2,NX3]);!r3;!r4]",
    also = { "alkyl ether" },
    examples = { "CCOCC", "COc1ccccc1", "C1CCOC1", "COCc1ccccc1", { "C1COCCO1", 2 } },
    non_examples = { "COC(C)=O", "C1CO1", "COCOC", "C=COC", "CO[Si](C)(C)C" },
}

group "aryl-alkyl-ether" {
    name = "aryl alkyl ether",
    smarts = "[OX2;H0;$(O(c)[CX4]);!$(O[CX3]);!$(O[CX4][OX2,SX2,NX3]);!r3;!r4]",
    parents = { "ether" },
    examples = { "COc1ccccc1", "CCOc1ccccc1", "C(Oc1ccccc1)c1ccccc1", { "COc1ccc(OC)cc1", 2 } },
    non_examples = { "c1ccc(Oc2ccccc2)cc1", "CCOCC", "CC(=O)Oc1ccccc1", "Oc1ccccc1" },
}

group "aryl-methyl-ether" {
    name = "aryl methyl ether",
    smarts = "[OX2;H0;$(Oc)][CH3]",
    parents = { "aryl-alkyl-ether" },
    examples = { "COc1ccccc1", { "COc1ccc(OC)cc1", 2 }, "COc1cccnc1" },
    non_examples = { "CCOc1ccccc1", "COCc1ccccc1", "COC(=O)c1ccccc1", "CSc1ccccc1" },
}

group "benzyl-ether" {
    name = "benzyl ether",
    smarts = "[OX2;H0;$(O([CX4])[CX4,c]);!$(O[CX3])][CX4;H2;$(Cc1ccccc1)]",
    parents = { "ether" },
    examples = { "COCc1ccccc1", "C(Oc1ccccc1)c1ccccc1", { "C(OCc1ccccc1)c1ccccc1", 2 }, "C1CCCC1OCc1ccccc1" },
    non_examples = { "CC(=O)OCc1ccccc1", "OCc1ccccc1", "CNC(=O)OCc1ccccc1", "COCCc1ccccc1" },
}

group "pmb-ether" {
    name = "p-methoxybenzyl ether",
    smarts = "[OX2;H0;$(O([CX4])[CX4,c]);!$(O[CX3])][CX4;H2]c1ccc(O[CH3])cc1",
    parents = { "benzyl-ether" },
    examples = { "CCOCc1ccc(OC)cc1", "COc1ccc(COC2CCCC2)cc1", "COc1ccc(COCCO)cc1" },
    non_examples = { "COCc1ccccc1", "OCc1ccc(OC)cc1", "CCOCc1cccc(OC)c1", "CC(=O)OCc1ccc(OC)cc1" },
}

group "allyl-ether" {
    name = "allyl ether",
    smarts = "[OX2;H0;!$(O[CX3]);!$(O[Si])][CX4;H2][CX3;H1]=[CX3;H2]",
    parents = { "ether" },
    examples = { "C=CCOCC", "C=CCOc1ccccc1", { "C=CCOCC=C", 2 } },
    non_examples = { "C=CCOC(C)=O", "C=CCO", "C=COC", "CCCOC" },
}

group "tert-butyl-ether" {
    name = "tert-butyl ether",
    smarts = "[OX2;H0;$(O[CX4,c]);!$(O[CX3])]C([CH3])([CH3])[CH3]",
    parents = { "ether" },
    examples = { "COC(C)(C)C", "CC(C)(C)Oc1ccccc1", "CC(C)(C)OCC(N)C(=O)O" },
    non_examples = { "CC(C)(C)O", "CC(C)(C)OC(C)=O", "CC(C)OC", "CC(C)(C)C" },
}

group "trityl-ether" {
    name = "trityl ether",
    smarts = "[OX2;H0][CX4](c1ccccc1)(c1ccccc1)c1ccccc1",
    parents = { "ether" },
    examples = {
        "CCOC(c1ccccc1)(c1ccccc1)c1ccccc1", "COC(c1ccccc1)(c1ccccc1)c1ccccc1", "OCCOC(c1ccccc1)(c1ccccc1)c1ccccc1",
    },
    non_examples = { "OC(c1ccccc1)(c1ccccc1)c1ccccc1", "COC(c1ccccc1)c1ccccc1", "CNC(c1ccccc1)(c1ccccc1)c1ccccc1" },
}

group "silyl-ether" {
    name = "silyl ether",
    smarts = "[OX2;$(O([#6])[Si]);!$(O[CX3])][SiX4]",
    examples = { "CO[Si](C)(C)C", "CC(C)(C)[Si](C)(C)OC1CCCC1", "C[Si](C)(C)Oc1ccccc1", { "CCO[Si](C)(C)OCC", 2 } },
    non_examples = { "C=CO[Si](C)(C)C", "C[Si](C)(C)C", "O[Si](C)(C)C", "COC(C)(C)C" },
}

group "tms-ether" {
    name = "trimethylsilyl ether",
    smarts = "[OX2;$(O([#6])[Si]);!$(O[CX3])][SiX4]([CH3])([CH3])[CH3]",
    parents = { "silyl-ether" },
    examples = { "CO[Si](C)(C)C", "C[Si](C)(C)OC1CCCC1", { "C[Si](C)(C)OCCO[Si](C)(C)C", 2 } },
    non_examples = { "CO[Si](CC)(CC)CC", "CO[Si](C)(C)C(C)(C)C", "C=CO[Si](C)(C)C" },
}

group "tes-ether" {
    name = "triethylsilyl ether",
    smarts = "[OX2;$(O([#6])[Si]);!$(O[CX3])][SiX4]([CH2][CH3])([CH2][CH3])[CH2][CH3]",
    parents = { "silyl-ether" },
    examples = { "CO[Si](CC)(CC)CC", "CC[Si](CC)(CC)OC1CCCC1", "CC[Si](CC)(CC)OCCO" },
    non_examples = { "CO[Si](C)(C)C", "CO[Si](C(C)C)(C(C)C)C(C)C", "CC[SiH](CC)CC" },
}

group "tbs-ether" {
    name = "tert-butyldimethylsilyl ether",
    smarts = "[OX2;$(O([#6])[Si]);!$(O[CX3])][SiX4]([CH3])([CH3])C([CH3])([CH3])[CH3]",
    parents = { "silyl-ether" },
    examples = {
        "CO[Si](C)(C)C(C)(C)C", "CC(C)(C)[Si](C)(C)OC1CCCC1", { "CC(C)(C)[Si](C)(C)OCCO[Si](C)(C)C(C)(C)C", 2 },
    },
    non_examples = { "CO[Si](C)(C)C", "CO[Si](c1ccccc1)(c1ccccc1)C(C)(C)C", "C=CO[Si](C)(C)C(C)(C)C" },
}

group "tips-ether" {
    name = "triisopropylsilyl ether",
    smarts = "[OX2;$(O([#6])[Si]);!$(O[CX3])][SiX4]([CH1]([CH3])[CH3])([CH1]([CH3])[CH3])[CH1]([CH3])[CH3]",
    parents = { "silyl-ether" },
    examples = { "CO[Si](C(C)C)(C(C)C)C(C)C", "CC(C)[Si](OC1CCCC1)(C(C)C)C(C)C", "CC(C)[Si](OCCO)(C(C)C)C(C)C" },
    non_examples = { "CO[Si](CC)(CC)CC", "CO[Si](C)(C)C(C)(C)C", "C#C[Si](C(C)C)(C(C)C)C(C)C" },
}

group "tbdps-ether" {
    name = "tert-butyldiphenylsilyl ether",
    smarts = "[OX2;$(O([#6])[Si]);!$(O[CX3])][SiX4](c1ccccc1)(c1ccccc1)C([CH3])([CH3])[CH3]",
    parents = { "silyl-ether" },
    examples = {
        "CO[Si](c1ccccc1)(c1ccccc1)C(C)(C)C", "CC(C)(C)[Si](OCCO)(c1ccccc1)c1ccccc1",
        "CC(C)(C)[Si](OC1CCCC1)(c1ccccc1)c1ccccc1",
    },
    non_examples = { "CO[Si](C)(C)C(C)(C)C", "CO[Si](C)(C)c1ccccc1", "CC(C)(C)[Si](Cl)(c1ccccc1)c1ccccc1" },
}

group "aryl-silyl-ether" {
    name = "silyl ether of a phenol",
    smarts = "[OX2;$(Oc)][SiX4]",
    parents = { "silyl-ether" },
    examples = { "C[Si](C)(C)Oc1ccccc1", "CC(C)(C)[Si](C)(C)Oc1ccccc1", "CC(C)[Si](Oc1ccc(C)cc1)(C(C)C)C(C)C" },
    non_examples = { "CO[Si](C)(C)C", "COc1ccccc1", "C[Si](C)(C)c1ccccc1" },
}

group "acetal" {
    name = "acetal or ketal",
    smarts = "[OX2;H0;!$(O[CX3])][CX4;!$(C([OX2])([OX2])[OX2])][OX2;H0;!$(O[CX3])]",
    also = { "acid-labile acetal" },
    examples = { "COC(C)OC", "COC(C)(C)OC", "C1COCO1", "CCOC1CCCCO1", "COCOC" },
    non_examples = { "COCCOC", "OC1CCCCO1", "COC(OC)OC", "CC(=O)OCOC", "CSC(C)SC" },
}

group "aldehyde-acetal" {
    name = "acetal of an aldehyde",
    smarts = "[OX2;H0;!$(O[CX3])][CX4;H1;$(C[#6]);!$(C([OX2])([OX2])[OX2])][OX2;H0;!$(O[CX3])]",
    parents = { "acetal" },
    examples = { "COC(C)OC", "COC(OC)c1ccccc1", "CC1OCCO1" },
    non_examples = { "COC(C)(C)OC", "COCOC", "COC(OC)OC", "OC1CCCCO1" },
}

group "thp-ether" {
    name = "tetrahydropyranyl ether",
    smarts = "[OX2;H0;!R;!$(O[CX3])][CX4;H1]1[OX2][CH2][CH2][CH2][CH2]1",
    parents = { "aldehyde-acetal" },
    also = { "THP ether" },
    examples = { "CCOC1CCCCO1", "C1CCC(C1)OC1CCCCO1", "OCCOC1CCCCO1" },
    non_examples = { "OC1CCCCO1", "COC1CCCCC1", "CCOCC1CCCCO1", "CC(=O)OC1CCCCO1" },
}

group "mom-ether" {
    name = "methoxymethyl ether",
    smarts = "[OX2;H0;!$(O[CX3])][CX4;H2][OX2][CH3]",
    parents = { "acetal" },
    also = { "MOM ether" },
    examples = { "CCOCOC", "COCOc1ccccc1", "COCOC1CCCC1" },
    non_examples = { "COCCOC", "COCOC(C)=O", "C1OCO1", "CCOC(C)OC" },
}

group "epoxide" {
    smarts = "[CX4;r3]1[OX2;r3][CX4;r3]1",
    examples = { "C1CO1", "CC1CO1", "C1CCC2OC2C1", { "C1OC1CC1CO1", 2 } },
    non_examples = { "C1CNC1", "C1COC1", "C1CN1", "COC" },
}

group "aziridine" {
    smarts = "[CX4;r3]1[NX3;r3][CX4;r3]1",
    examples = { "C1CN1", "CC1CN1", "C1CN1S(=O)(=O)c1ccccc1", "C1CCC2NC2C1" },
    non_examples = { "C1CNC1", "C1CO1", "CNC", "C1CC1" },
}

group "oxetane" {
    smarts = "[CX4;r4]1[OX2;r4][CX4;r4][CX4;r4]1",
    examples = { "C1COC1", "C1C2(CCC2)CO1", "OC1COC1" },
    non_examples = { "C1CO1", "C1CCOC1", "O=C1CCO1", "C1CNC1" },
}

group "ketal" {
    smarts = "[OX2;H0;!$(O[CX3])][CX4;H0;$(C([#6])[#6])][OX2;H0;!$(O[CX3])]",
    parents = { "acetal" },
    examples = { "COC(C)(C)OC", "C1CCC2(CC1)OCCO2", "CC1(C)OCCO1" },
    non_examples = { "COC(C)OC", "COC(C)(C)C", "COCOC", "CC(C)(OC)OC(C)=O" },
}

group "dioxolane" {
    name = "1,3-dioxolane (ethylene acetal)",
    smarts = "[CX4;$(C[#6])]1[OX2][CH2][CH2][OX2]1",
    parents = { "acetal" },
    examples = { "CC1OCCO1", "C1CCC2(CC1)OCCO2", "CC1(C)OCCO1", "c1ccc(cc1)C1OCCO1" },
    non_examples = { "C1COCO1", "CC1OCCCO1", "CC1(C)OCC(C)O1", "C1COCCO1" },
}

group "acetonide" {
    smarts = "[OX2;R;!$(O[CX3])][CX4;R]([CH3])([CH3])[OX2;R;!$(O[CX3])]",
    parents = { "ketal" },
    examples = { "CC1(C)OCCO1", "CC1(C)OCC(CO)O1", "CC1(C)OCCCO1" },
    non_examples = { "CC1OCCO1", "COC(C)(C)OC", "CC1(C)OC(=O)C(C)O1", "C1CCC2(CC1)OCCO2" },
}

group "benzylidene-acetal" {
    name = "benzylidene acetal",
    smarts = "[OX2;R;!$(O[CX3])][CX4;H1;R;$(Cc1ccccc1)][OX2;R;!$(O[CX3])]",
    parents = { "aldehyde-acetal" },
    examples = { "C1COC(O1)c1ccccc1", "C1COC(OC1)c1ccccc1", "OCC1COC(O1)c1ccccc1" },
    non_examples = { "COC(OC)c1ccccc1", "CC1OCCO1", "O=C1COC(O1)c1ccccc1" },
}

group "methylenedioxyarene" {
    smarts = "[OX2;r5;$(Oc)][CX4;H2;r5][OX2;r5;$(Oc)]",
    parents = { "acetal" },
    examples = { "C1Oc2ccccc2O1", "O=Cc1ccc2OCOc2c1", "C=CCc1ccc2OCOc2c1" },
    non_examples = { "C1COc2ccccc2O1", "CC1Oc2ccccc2O1", "C1COCO1", "COCOc1ccccc1" },
}

group "hemiacetal" {
    smarts = "[OX2;H1][CX4][OX2;H0;!$(O[CX3])]",
    examples = { "OC1CCCCO1", "CCOC(C)O", "COC(C)(C)O", "OCC1OC(O)C(O)C(O)C1O" },
    non_examples = { "COC(C)OC", "OCCO", "OCCOC", "CC(=O)OCO" },
}

group "enol-ether" {
    name = "enol ether",
    smarts = "[CX3;!$(C[CX3]=[OX1]);!$(CC#N)]=[CX3][OX2;H0;$(O[CX4,c])]",
    examples = { "C=COC", "C1CCOC=C1", "COC1=CCCCC1", "CCOC=CC" },
    non_examples = { "COC(C)=O", "COC=CC(C)=O", "C=CCOC", "C=CO[Si](C)(C)C", "COc1ccccc1" },
}

group "silyl-enol-ether" {
    name = "silyl enol ether",
    smarts = "[CX3]=[CX3][OX2][SiX4]",
    examples = { "C=CO[Si](C)(C)C", "C[Si](C)(C)OC1=CCCCC1", "CC=C(O[Si](C)(C)C(C)(C)C)OC" },
    non_examples = { "C=COC", "CO[Si](C)(C)C", "C=CC[Si](C)(C)C" },
}

group "aldehyde" {
    smarts = "[CX3;H1;$(C[#6])]=[OX1]",
    examples = { "CC=O", "O=Cc1ccccc1", "O=CC=C", { "O=CCCC=O", 2 } },
    non_examples = { "CC(C)=O", "OC=O", "CN(C)C=O", "CC(O)=O" },
}

group "aryl-aldehyde" {
    name = "aryl aldehyde",
    smarts = "[CX3;H1;$(Cc)]=[OX1]",
    parents = { "aldehyde" },
    examples = { "O=Cc1ccccc1", "O=Cc1ccco1", { "O=Cc1ccc(C=O)cc1", 2 } },
    non_examples = { "CC=O", "O=CCc1ccccc1", "CC(=O)c1ccccc1", "O=CC=Cc1ccccc1" },
}

group "ketone" {
    smarts = "[CX3;$(C([#6])[#6])]=[OX1]",
    examples = { "CC(C)=O", "CC(=O)c1ccccc1", "C=CC(C)=O", { "CC(=O)CC(C)=O", 2 } },
    non_examples = { "CC=O", "CC(=O)OC", "CC(N)=O", "CC(=O)Cl" },
}

group "alkyl-ketone" {
    name = "dialkyl ketone",
    smarts = "[CX3;$(C([CX4])[CX4])]=[OX1]",
    parents = { "ketone" },
    examples = { "CC(C)=O", "O=C1CCCCC1", "CC(=O)CCc1ccccc1" },
    non_examples = { "CC(=O)c1ccccc1", "C=CC(C)=O", "CC=O", "CC(=O)OC" },
}

group "enolisable-ketone" {
    name = "enolisable ketone (alpha C-H)",
    smarts = "[CX3;$(C([#6])[#6]);$(C[CX4;!H0])]=[OX1]",
    also = { "methylene ketone" },
    examples = { "CC(C)=O", "CC(=O)c1ccccc1", "O=C1CCCCC1", { "CC(=O)CC(C)=O", 2 } },
    non_examples = { "O=C(c1ccccc1)c1ccccc1", "CC=O", "CC(=O)OC", "C=CC(=O)c1ccccc1", "CC(C)(C)C(=O)c1ccccc1" },
}

group "aryl-ketone" {
    name = "aryl ketone",
    smarts = "[CX3;$(C(c)[#6])]=[OX1]",
    parents = { "ketone" },
    examples = { "CC(=O)c1ccccc1", "O=C(c1ccccc1)c1ccccc1", "O=C1CCCc2ccccc12", "CC(=O)c1cccs1" },
    non_examples = { "CC(C)=O", "O=Cc1ccccc1", "CC(=O)Cc1ccccc1", "COC(=O)c1ccccc1" },
}

group "alkene" {
    smarts = "[CX3]=[CX3]",
    also = { "cyclohexene" },
    examples = { "C=C", "CC=C", "C1CCCC=C1", { "C=CC=C", 2 }, "C=CC(C)=O" },
    non_examples = { "CC#C", "c1ccccc1", "CC=O", "CC=NC", "C=C=C" },
}

group "michael-acceptor" {
    name = "alkene with an acceptor (Michael acceptor)",
    smarts = "[CX3]=[CX3][$([CX3]=[OX1]),$(C#N),$(S(=O)=O),$([N+](=O)[O-])]",
    parents = { "alkene" },
    also = { "activated alkene" },
    examples = { "C=CC(C)=O", "C=CC#N", "C=CC(=O)OC", "C=CS(C)(=O)=O", "C=C[N+](=O)[O-]" },
    non_examples = { "C=CCC(C)=O", "C=COC(C)=O", "C=Cc1ccccc1", "C#CC(C)=O" },
}

group "enone" {
    smarts = "[CX3;$(C([#6])[#6])](=[OX1])[CX3]=[CX3]",
    parents = { "ketone", "michael-acceptor" },
    examples = { "C=CC(C)=O", "O=C1CCCC=C1", "CC(=O)C=Cc1ccccc1", "CC1=CC(=O)CCC1" },
    non_examples = { "C=CC=O", "C=CCC(C)=O", "C=CC(=O)OC", "CC(=O)c1ccccc1" },
}

group "quinone" {
    smarts = "[CX3;$(C1(=[OX1])[#6]~[#6][CX3](=[OX1])[#6]~[#6]1),$(C1(=[OX1])[CX3](=[OX1])[#6]~[#6]~[#6]~[#6]1)](=[OX1])[CX3]=[CX3]",
    parents = { "enone" },
    examples = { { "O=C1C=CC(=O)C=C1", 4 }, { "COC1=CC(=O)C=C(OC)C1=O", 4 }, { "O=C1C=CC(=O)c2ccccc12", 2 } },
    non_examples = { "O=C1CCCC=C1", "Oc1ccc(O)cc1", "O=C1CCC(=O)CC1", "CC(=O)C=CC(C)=O" },
}

group "acidic-ch" {
    name = "acidic C-H between two acceptors",
    smarts = "[CX4;!H0;$(C([$([CX3]=[OX1]),$(C#N),$(S(=O)=O),$([N+](=O)[O-])])[$([CX3]=[OX1]),$(C#N),$(S(=O)=O),$([N+](=O)[O-])])]",
    also = { "acidic CH", "active methylene" },
    examples = { "CC(=O)CC(C)=O", "CCOC(=O)CC(=O)OCC", "N#CCC#N", "N#CCC(=O)OC" },
    non_examples = { "CC(=O)CCC(C)=O", "CC(C)=O", "COC(=O)C(C)(C)C(=O)OC", "CC(=O)C(C)=O" },
}

group "1-3-diketone" {
    name = "1,3-diketone",
    smarts = "[CX3;$(C([#6])[#6])](=[OX1])[CX4;!H0][CX3;$(C([#6])[#6])]=[OX1]",
    parents = { "ketone", "acidic-ch" },
    examples = { "CC(=O)CC(C)=O", "O=C1CCCC(=O)C1", "CC(=O)CC(=O)c1ccccc1" },
    non_examples = { "CC(=O)C(C)=O", "CC(=O)CCC(C)=O", "CC(=O)CC(=O)OC", "CC(=O)C(C)(C)C(C)=O" },
}

group "carboxylic-acid" {
    name = "carboxylic acid or carboxylate",
    smarts = "[CX3;$(C[#6]),$([CX3;H1])](=[OX1])[$([OX2;H1]),$([OX1;-])]",
    also = { "free acid", "acid" },
    examples = { "CC(O)=O", "OC(=O)c1ccccc1", "CC([O-])=O", { "OC(=O)CCC(O)=O", 2 } },
    non_examples = { "CC(=O)OC", "CC=O", "CC(N)=O", "NC(O)=O" },
}

group "beta-keto-acid" {
    name = "beta-keto or malonic acid",
    smarts = "[CX3](=[OX1])([OX2;H1])[CX4][CX3;$(C[#6,#8])]=[OX1]",
    parents = { "carboxylic-acid" },
    examples = { "CC(=O)CC(O)=O", "OC(=O)CC(=O)OCC", "OC(=O)C1CCCCC1=O" },
    non_examples = { "CC(=O)CCC(O)=O", "CC(=O)CC(=O)OC", "OC(=O)CC#N" },
}

group "ester" {
    smarts = "[CX3;$(C[#6]),$([CX3;H1])](=[OX1])[OX2;H0;!$(O([CX3]=[OX1])[CX3]=[OX1])][#6]",
    examples = { "CC(=O)OC", "CCOC=O", "O=C1CCCO1", "CC(=O)Oc1ccccc1", { "COC(=O)CCC(=O)OC", 2 } },
    non_examples = { "CC(O)=O", "CC(=O)OC(C)=O", "COC(=O)OC", "CNC(=O)OC", "CC(N)=O" },
}

group "enolisable-ester" {
    name = "enolisable ester (alpha C-H)",
    smarts = "[CX3;$(C[CX4;!H0])](=[OX1])[OX2;H0;!$(O([CX3]=[OX1])[CX3]=[OX1])][#6]",
    examples = { "CC(=O)OC", "CCOC(=O)CCC", "O=C1CCCO1", { "COC(=O)CCC(=O)OC", 2 } },
    non_examples = { "COC(=O)c1ccccc1", "COC(=O)C(C)(C)C", "C=CC(=O)OC", "CCOC=O", "CC(=O)O" },
}

group "methyl-ester" {
    name = "methyl ester",
    smarts = "[CX3;$(C[#6]),$([CX3;H1])](=[OX1])[OX2][CH3]",
    parents = { "ester" },
    examples = { "CC(=O)OC", "COC(=O)c1ccccc1", { "COC(=O)CCC(=O)OC", 2 } },
    non_examples = { "CCOC(C)=O", "COC(=O)OC", "CC(=O)CO", "COC(C)C" },
}

group "ethyl-ester" {
    name = "ethyl ester",
    smarts = "[CX3;$(C[#6]),$([CX3;H1])](=[OX1])[OX2][CH2][CH3]",
    parents = { "ester" },
    examples = { "CCOC(C)=O", "CCOC(=O)c1ccccc1", { "CCOC(=O)CC(=O)OCC", 2 } },
    non_examples = { "CC(=O)OC", "CC(=O)OCCO", "CCOCC", "CCOC(=O)OCC" },
}

group "tert-butyl-ester" {
    name = "tert-butyl ester",
    smarts = "[CX3;$(C[#6]),$([CX3;H1])](=[OX1])[OX2]C([CH3])([CH3])[CH3]",
    parents = { "ester" },
    examples = { "CC(=O)OC(C)(C)C", "CC(C)(C)OC(=O)c1ccccc1", "CC(C)(C)OC(=O)CN" },
    non_examples = { "CC(C)(C)OC(=O)NC", "CC(=O)OC(C)C", "CC(C)(C)OC", "COC(=O)C(C)(C)C" },
}

group "benzyl-ester" {
    name = "benzyl ester",
    smarts = "[CX3;$(C[#6]),$([CX3;H1])](=[OX1])[OX2][CX4;H2;$(Cc1ccccc1)]",
    parents = { "ester" },
    examples = { "CC(=O)OCc1ccccc1", "O=C(OCc1ccccc1)c1ccccc1", "NCC(=O)OCc1ccccc1" },
    non_examples = { "COC(=O)Cc1ccccc1", "CNC(=O)OCc1ccccc1", "COCc1ccccc1", "CC(=O)OCCc1ccccc1" },
}

group "allyl-ester" {
    name = "allyl ester",
    smarts = "[CX3;$(C[#6]),$([CX3;H1])](=[OX1])[OX2][CX4][CX3]=[CX3]",
    parents = { "ester" },
    also = { "allylic ester" },
    examples = { "C=CCOC(C)=O", "CC(=O)OC1CCCC=C1", "C=CCOC(=O)c1ccccc1" },
    non_examples = { "C=CC(=O)OC", "C=COC(C)=O", "C=CCOC(=O)NC", "CC(=O)OCCC=C" },
}

group "aryl-ester" {
    name = "aryl ester",
    smarts = "[CX3;$(C[#6]),$([CX3;H1])](=[OX1])[OX2]c",
    parents = { "ester" },
    examples = { "CC(=O)Oc1ccccc1", "O=C(Oc1ccccc1)c1ccccc1", "CC(=O)Oc1ccccc1C(O)=O" },
    non_examples = { "COC(=O)c1ccccc1", "COc1ccccc1", "CC(=O)OCc1ccccc1", "CNC(=O)Oc1ccccc1" },
}

group "acetate-ester" {
    name = "acetate",
    smarts = "[CH3][CX3](=[OX1])[OX2][#6;X4,c;!$([CX4;H3]);!$([CH2][CH3]);!$(C([CH3])([CH3])[CH3])]",
    parents = { "ester" },
    examples = { "CC(=O)OC1CCCCC1", "CC(=O)Oc1ccccc1", { "CC(=O)OCCOC(C)=O", 2 } },
    non_examples = { "CC(=O)OC", "CC(=O)OCC", "CCC(=O)OC1CCCCC1", "CC(=O)NC", "CC(=O)OC(C)=O" },
}

group "benzoate-ester" {
    name = "benzoate",
    smarts = "[CX3;$(Cc1[cH][cH]c[cH][cH]1)](=[OX1])[OX2][CX4;!H3;!$([CH2][CH3]);!$(C([CH3])([CH3])[CH3])]",
    parents = { "ester" },
    examples = { "O=C(OC1CCCCC1)c1ccccc1", "O=C(OCCO)c1ccccc1", "CC(C)OC(=O)c1ccc(C)cc1" },
    non_examples = { "COC(=O)c1ccccc1", "CC(=O)OC1CCCCC1", "CNC(=O)c1ccccc1", "OC(=O)c1ccccc1" },
}

group "pivalate-ester" {
    name = "pivalate",
    smarts = "[CX3;$(CC([CH3])([CH3])[CH3])](=[OX1])[OX2;H0][#6]",
    parents = { "ester" },
    examples = { "CC(C)(C)C(=O)OC", "CC(C)(C)C(=O)OC1CCCC1", "CC(C)(C)C(=O)OCc1ccccc1" },
    non_examples = { "CC(=O)OC(C)(C)C", "CC(C)C(=O)OC", "CC(C)(C)C(N)=O" },
}

group "lactone" {
    smarts = "[CX3;R;$(C[#6])](=[OX1])@[OX2;R;H0]@[#6]",
    parents = { "ester" },
    examples = { "O=C1CCCO1", "O=C1CCCCO1", "O=C1OCC2CCCC12" },
    non_examples = { "CCOC(C)=O", "O=C1CCCN1", "O=C1OCCO1", "OC1CCCO1" },
}

group "activated-ester" {
    name = "activated ester (NHS, pentafluorophenyl, nitrophenyl)",
    smarts = "[CX3;$(C[#6])](=[OX1])[OX2][$([NX3]1C(=O)CCC1=O),$(c1c(F)c(F)c(F)c(F)c1F),$(c1ccc([N+](=O)[O-])cc1)]",
    examples = { "CC(=O)ON1C(=O)CCC1=O", "CC(=O)Oc1c(F)c(F)c(F)c(F)c1F", "CC(=O)Oc1ccc(cc1)[N+](=O)[O-]" },
    non_examples = { "CC(=O)Oc1ccccc1", "CC(=O)OC", "CC(=O)N1C(=O)CCC1=O" },
}

group "carbonate" {
    smarts = "[OX2;H0;$(O[#6])][CX3](=[OX1])[OX2;H0;$(O[#6])]",
    examples = { "COC(=O)OC", "O=C1OCCO1", "CC(C)(C)OC(=O)Oc1ccccc1" },
    non_examples = { "COC(C)=O", "CNC(=O)OC", "COC(=O)Cl", "COC(C)OC" },
}

group "acyl-halide" {
    name = "acid halide, chloroformate",
    smarts = "[CX3](=[OX1])[F,Cl,Br,I]",
    also = { "acid chloride", "acid halide" },
    examples = { "CC(=O)Cl", "O=C(Cl)c1ccccc1", "COC(=O)Cl", "CC(=O)Br", { "ClC(=O)CCC(=O)Cl", 2 } },
    non_examples = { "CCl", "CC(Cl)C=O", "CC(=O)OC", "CS(=O)(=O)Cl" },
}

group "anhydride" {
    smarts = "[CX3;$(C[#6]),$([CX3;H1])](=[OX1])[OX2][CX3;$(C[#6]),$([CX3;H1])]=[OX1]",
    examples = { "CC(=O)OC(C)=O", "O=C1CCC(=O)O1", "O=C1OC(=O)c2ccccc12" },
    non_examples = { "CC(=O)OC", "O=C1CCC(=O)N1", "CC(=O)OOC(C)=O", "CC(=O)CC(C)=O" },
}

group "sulfonyl-chloride" {
    name = "sulfonyl chloride",
    smarts = "[SX4;$(S[#6])](=[OX1])(=[OX1])[Cl,Br]",
    examples = { "CS(=O)(=O)Cl", "Cc1ccc(cc1)S(=O)(=O)Cl", "O=S(=O)(Cl)c1ccccc1" },
    non_examples = { "CS(N)(=O)=O", "CS(=O)(=O)OC", "CS(C)(=O)=O", "CC(=O)Cl", "CS(=O)(=O)O" },
}

group "alkyl-sulfonate" {
    name = "alkyl sulfonate (mesylate, tosylate)",
    smarts = "[CX4][OX2][SX4;$(S[#6])](=[OX1])=[OX1]",
    also = { "sulfonate", "mesylate", "tosylate" },
    examples = { "COS(C)(=O)=O", "CCOS(=O)(=O)c1ccc(C)cc1", "CS(=O)(=O)OC1CCCC1" },
    non_examples = { "CS(=O)(=O)Oc1ccccc1", "CS(N)(=O)=O", "COS(C)=O", "CS(=O)(=O)O" },
}

group "aryl-triflate" {
    name = "aryl or vinyl triflate",
    smarts = "[OX2;$(Oc),$(O[CX3]=[CX3])][SX4](=[OX1])(=[OX1])C(F)(F)F",
    also = { "triflate" },
    examples = { "O=S(=O)(Oc1ccccc1)C(F)(F)F", "O=S(=O)(OC1=CCCCC1)C(F)(F)F", "COc1ccc(OS(=O)(=O)C(F)(F)F)cc1" },
    non_examples = { "CS(=O)(=O)Oc1ccccc1", "COS(=O)(=O)C(F)(F)F", "NS(=O)(=O)C(F)(F)F" },
}

group "sulfoxide" {
    smarts = "[SX3;$(S([#6])[#6])]~[OX1]",
    examples = { "CS(C)=O", "CS(=O)c1ccccc1", "C[S+](C)[O-]" },
    non_examples = { "CS(C)(=O)=O", "CSC", "CS(=O)O", "CS(=O)Cl" },
}

group "sulfone" {
    smarts = "[SX4;$(S([#6])[#6])](=[OX1])=[OX1]",
    examples = { "CS(C)(=O)=O", "CS(=O)(=O)c1ccccc1", "O=S1(=O)CCCC1" },
    non_examples = { "CS(C)=O", "CS(N)(=O)=O", "CS(=O)(=O)OC", "CSC" },
}

group "phosphonium" {
    name = "phosphonium salt",
    smarts = "[PX4;+;H0]",
    examples = { "C[P+](C)(C)C", "C[P+](c1ccccc1)(c1ccccc1)c1ccccc1", "CCOC(=O)C[P+](c1ccccc1)(c1ccccc1)c1ccccc1" },
    non_examples = { "CP(C)C", "CP(C)(C)=O", "C[N+](C)(C)C" },
}

group "alkyl-halide" {
    name = "alkyl chloride, bromide or iodide",
    smarts = "[CX4;!$(C([F,Cl,Br,I])[F,Cl,Br,I])][Cl,Br,I]",
    examples = { "CBr", "CCCCl", "CC(C)Br", "CC(C)(C)Cl", { "ICCCI", 2 } },
    non_examples = { "Clc1ccccc1", "C=CBr", "CC(=O)Cl", "CCF", "FC(F)(F)Cl" },
}

group "primary-alkyl-halide" {
    name = "primary alkyl halide",
    smarts = "[CX4;H2;!$(C([F,Cl,Br,I])[F,Cl,Br,I]);$(C[#6])][Cl,Br,I]",
    parents = { "alkyl-halide" },
    examples = { "CCBr", "CCCCl", "C=CCBr", { "ICCCI", 2 } },
    non_examples = { "CC(C)Br", "CC(C)(C)Cl", "Clc1ccccc1", "CCF", "CI" },
}

group "secondary-alkyl-halide" {
    name = "secondary alkyl halide",
    smarts = "[CX4;H1;!$(C([F,Cl,Br,I])[F,Cl,Br,I]);$(C([#6])[#6])][Cl,Br,I]",
    parents = { "alkyl-halide" },
    examples = { "CC(C)Br", "BrC1CCCCC1", "CC(Cl)c1ccccc1" },
    non_examples = { "CCBr", "CC(C)(C)Cl", "C=CBr", "Brc1ccccc1" },
}

group "tertiary-alkyl-halide" {
    name = "tertiary alkyl halide",
    smarts = "[CX4;H0;!$(C([F,Cl,Br,I])[F,Cl,Br,I]);$(C([#6])([#6])[#6])][Cl,Br,I]",
    parents = { "alkyl-halide" },
    examples = { "CC(C)(C)Cl", "CC1(Br)CCCCC1", "ClC12CC3CC(CC(C3)C1)C2" },
    non_examples = { "CC(C)Br", "CC(C)(C)O", "CC(C)(Cl)Cl", "CC(C)(C)F" },
}

group "alkyl-iodide" {
    name = "alkyl iodide",
    smarts = "[CX4;!$(C([F,Cl,Br,I])[F,Cl,Br,I])]I",
    parents = { "alkyl-halide" },
    examples = { "CI", "CCCI", "IC1CCCCC1", { "ICCCI", 2 } },
    non_examples = { "CCBr", "Ic1ccccc1", "C=CI", "CC(=O)I" },
}

group "allylic-halide" {
    name = "allylic halide",
    smarts = "[CX4;!$(C([F,Cl,Br,I])[F,Cl,Br,I]);$(C[CX3]=[CX3])][Cl,Br,I]",
    parents = { "alkyl-halide" },
    also = { "allyl halide" },
    examples = { "C=CCBr", "CC(C)=CCCl", "BrC1CCCC=C1" },
    non_examples = { "C=CBr", "C=CCCBr", "BrCc1ccccc1", "C=CCO" },
}

group "benzylic-halide" {
    name = "benzylic halide",
    smarts = "[CX4;!$(C([F,Cl,Br,I])[F,Cl,Br,I]);$(Cc)][Cl,Br,I]",
    parents = { "alkyl-halide" },
    also = { "benzyl halide" },
    examples = { "BrCc1ccccc1", "CC(Cl)c1ccccc1", "ClCc1ccncc1", { "BrCc1ccc(CBr)cc1", 2 } },
    non_examples = { "BrCCc1ccccc1", "Brc1ccccc1", "OCc1ccccc1", "FC(F)(F)c1ccccc1" },
}

group "alpha-halo-carbonyl" {
    name = "alpha-halo ketone, ester or amide",
    smarts = "[CX4;!$(C([F,Cl,Br,I])[F,Cl,Br,I])]([Cl,Br,I])[CX3]=[OX1]",
    parents = { "alkyl-halide" },
    also = { "α-halo ketone", "alpha-halo ketone" },
    examples = { "CC(=O)CBr", "COC(=O)CCl", "BrCC(=O)c1ccccc1", "CC(Br)C(=O)OCC" },
    non_examples = { "CC(=O)CCBr", "CC(=O)Br", "CC(=O)CO", "CC(=O)c1ccc(Br)cc1" },
}

group "vinyl-halide" {
    name = "vinyl halide",
    smarts = "[CX3]=[CX3][Cl,Br,I]",
    examples = { "C=CBr", "CC=CI", "ClC1=CCCCC1" },
    non_examples = { "C=CCBr", "Brc1ccccc1", "CC(=O)Br", "C=CF", "C#CBr" },
}

group "aryl-halide" {
    name = "aryl halide",
    smarts = "c[F,Cl,Br,I]",
    examples = { "Fc1ccccc1", "Clc1ccccc1", "Brc1ccncc1", { "Ic1ccc(Br)cc1", 2 } },
    non_examples = { "ClCc1ccccc1", "C=CBr", "ClC1CCCCC1", "O=C(Cl)c1ccccc1" },
}

group "aryl-iodide" {
    name = "aryl iodide",
    smarts = "cI",
    parents = { "aryl-halide" },
    examples = { "Ic1ccccc1", "COc1ccc(I)cc1", { "Ic1ccc(I)cc1", 2 } },
    non_examples = { "Brc1ccccc1", "ICc1ccccc1", "C=CI", "CI" },
}

group "aryl-bromide" {
    name = "aryl bromide",
    smarts = "cBr",
    parents = { "aryl-halide" },
    examples = { "Brc1ccccc1", "Brc1ccc(I)cc1", "Brc1cccs1" },
    non_examples = { "Ic1ccccc1", "BrCc1ccccc1", "C=CBr", "CBr" },
}

group "aryl-chloride" {
    name = "aryl chloride",
    smarts = "cCl",
    parents = { "aryl-halide" },
    examples = { "Clc1ccccc1", { "Clc1ccc(Cl)cc1", 2 }, "Clc1cccnc1" },
    non_examples = { "ClCc1ccccc1", "Fc1ccccc1", "O=C(Cl)c1ccccc1", "CCl" },
}

group "aryl-fluoride" {
    name = "aryl fluoride",
    smarts = "cF",
    parents = { "aryl-halide" },
    examples = { "Fc1ccccc1", { "Fc1ccc(F)cc1", 2 }, "Fc1cccc(Br)c1" },
    non_examples = { "FC(F)(F)c1ccccc1", "Clc1ccccc1", "CCF", "FCc1ccccc1" },
}

group "activated-aryl-halide" {
    name = "aryl halide activated for SNAr (o- or p-nitro, cyano, acyl, sulfonyl)",
    smarts = "[c;$(c:c[$([N+](=O)[O-]),$([CX3]=[OX1]),$(S(=O)=O),$(C#N)]),$(c1:c:c:c([$([N+](=O)[O-]),$([CX3]=[OX1]),$(S(=O)=O),$(C#N)]):c:c:1)][F,Cl]",
    parents = { "aryl-halide" },
    also = { "activated aryl fluoride", "activated aryl chloride" },
    examples = { "O=[N+]([O-])c1ccc(F)cc1", "O=[N+]([O-])c1ccccc1Cl", "N#Cc1ccc(F)cc1", "O=Cc1ccccc1F" },
    non_examples = { "O=[N+]([O-])c1cccc(F)c1", "Fc1ccccc1", "O=[N+]([O-])c1ccc(I)cc1", "COc1ccc(F)cc1" },
}

group "activated-heteroaryl-halide" {
    name = "2- or 4-halo azine (SNAr)",
    smarts = "[c;r6;$(c:[nX2;r6]),$(c1:c:c:[nX2]:c:c:1)][F,Cl,Br]",
    parents = { "aryl-halide" },
    also = { "chloroazine", "activated heteroaryl chloride" },
    examples = { "Clc1ccccn1", "Clc1ccncc1", "Clc1ncccn1", { "Clc1nc(Cl)ncc1", 2 } },
    non_examples = { "Clc1cccnc1", "Clc1ccccc1", "ClCc1ccccn1", "Ic1ccccn1" },
}

group "trifluoromethyl" {
    smarts = "[CX4;$(C[#6])](F)(F)F",
    examples = { "FC(F)(F)c1ccccc1", "CC(F)(F)F", "OC(=O)C(F)(F)F" },
    non_examples = { "CCF", "Fc1ccccc1", "CC(F)F", "FC(F)(F)Cl" },
}

group "boronic-acid" {
    name = "boronic acid",
    smarts = "[BX3;$(B[#6])]([OX2;H1])[OX2;H1]",
    examples = { "OB(O)c1ccccc1", "CB(O)O", "OB(O)C=C" },
    non_examples = { "CC1(C)OB(OC1(C)C)c1ccccc1", "OB(O)O", "CB(C)C" },
}

group "boronic-ester" {
    name = "boronic ester",
    smarts = "[BX3;$(B[#6])]([OX2;H0])[OX2;H0]",
    also = { "boronate" },
    examples = { "CC1(C)OB(OC1(C)C)c1ccccc1", "COB(OC)C", "C=CB1OC(C)(C)C(C)(C)O1" },
    non_examples = { "OB(O)c1ccccc1", "COB(OC)OC", "CB(C)C" },
}

group "organotin" {
    name = "organostannane",
    smarts = "[SnX4;$([Sn][#6])]",
    also = { "stannane" },
    examples = { "C[Sn](C)(C)C", "CCCC[Sn](CCCC)(CCCC)c1ccccc1", "C=C[Sn](CCCC)(CCCC)CCCC" },
    non_examples = { "C[Si](C)(C)C", "C[Ge](C)(C)C", "Cl[Sn](Cl)(Cl)Cl" },
}

group "organometal" {
    name = "organolithium, -magnesium or -zinc",
    smarts = "[#6][Li,Mg,Zn]",
    examples = { "[Li]C", "C[Mg]Br", "Br[Zn]Cc1ccccc1", { "CC[Zn]CC", 2 } },
    non_examples = { "C[Sn](C)(C)C", "CBr", "[Li]O" },
}

group "aryl-vinyl-silane" {
    name = "aryl- or vinylsilane",
    smarts = "[#6;$(c),$([CX3]=[CX3])][SiX4;!$([Si][OX2])]",
    examples = { "C[Si](C)(C)c1ccccc1", "C=C[Si](C)(C)C", "CC=C[Si](C)(C)C" },
    non_examples = { "C[Si](C)(C)C", "C=CC[Si](C)(C)C", "C#C[Si](C)(C)C", "C[Si](C)(C)Oc1ccccc1" },
}

group "alkyne" {
    smarts = "[CX2]#[CX2]",
    examples = { "C#C", "CC#C", "CC#CC", "C#Cc1ccccc1" },
    non_examples = { "C=C", "CC#N", "[C-]#[O+]", "C=C=C" },
}

group "alkynyl-silane" {
    name = "C-silyl alkyne",
    smarts = "[CX2]#[CX2][SiX4]",
    parents = { "alkyne" },
    examples = { "C#C[Si](C)(C)C", "C[Si](C)(C)C#Cc1ccccc1", "CC(C)[Si](C#CCO)(C(C)C)C(C)C" },
    non_examples = { "C#CC[Si](C)(C)C", "CC#CC", "C=C[Si](C)(C)C", "C#CCO[Si](C)(C)C" },
}

group "monosubstituted-alkene" {
    name = "monosubstituted alkene",
    smarts = "[CX3;H1;$(C[#6]);!$(C[$([CX3]=[OX1]),$(C#N),$(S(=O)=O),$([N+](=O)[O-])])]=[CX3;H2]",
    parents = { "alkene" },
    also = { "terminal alkene" },
    examples = { "CC=C", "C=CCCO", "C=Cc1ccccc1", { "C=CCCC=C", 2 } },
    non_examples = { "CC(C)=C", "CC=CC", "C=CC(C)=O", "C=CBr", "C=COC" },
}

group "1-1-disubstituted-alkene" {
    name = "1,1-disubstituted alkene",
    smarts = "[CX3;H0;$(C([#6])[#6]);!$(C[$([CX3]=[OX1]),$(C#N),$(S(=O)=O),$([N+](=O)[O-])])]=[CX3;H2]",
    parents = { "alkene" },
    examples = { "CC(C)=C", "C=C1CCCCC1", "CC(=C)CCO" },
    non_examples = { "CC=C", "CC=CC", "C=C(C)C(C)=O", "CC(Cl)=C" },
}

group "1-2-disubstituted-alkene" {
    name = "1,2-disubstituted alkene",
    smarts = "[CX3;H1;$(C[#6]);!$(C[$([CX3]=[OX1]),$(C#N),$(S(=O)=O),$([N+](=O)[O-])])]=[CX3;H1;$(C[#6]);!$(C[$([CX3]=[OX1]),$(C#N),$(S(=O)=O),$([N+](=O)[O-])])]",
    parents = { "alkene" },
    examples = { "CC=CC", "C1CCCC=C1", "CCC=CCCO", { "C1CC=CCCC=C1", 2 } },
    non_examples = { "CC=C", "CC(C)=CC", "CC=CC(C)=O", "CC=CBr", "c1ccccc1" },
}

group "trisubstituted-alkene" {
    name = "trisubstituted alkene",
    smarts = "[CX3;H0;$(C([#6])[#6]);!$(C[$([CX3]=[OX1]),$(C#N),$(S(=O)=O),$([N+](=O)[O-])])]=[CX3;H1;$(C[#6]);!$(C[$([CX3]=[OX1]),$(C#N),$(S(=O)=O),$([N+](=O)[O-])])]",
    parents = { "alkene" },
    examples = { "CC(C)=CC", "CC1=CCCCC1", "CC(C)=CCO" },
    non_examples = { "CC=CC", "CC(C)=C(C)C", "CC(C)=CC(C)=O", "CC(C)=CBr" },
}

group "tetrasubstituted-alkene" {
    name = "tetrasubstituted alkene",
    smarts = "[CX3;H0;$(C([#6])[#6]);!$(C[$([CX3]=[OX1]),$(C#N),$(S(=O)=O),$([N+](=O)[O-])])]=[CX3;H0;$(C([#6])[#6]);!$(C[$([CX3]=[OX1]),$(C#N),$(S(=O)=O),$([N+](=O)[O-])])]",
    parents = { "alkene" },
    examples = { "CC(C)=C(C)C", "CC1=C(C)CCCC1", "C1CCC(CC1)=C1CCCCC1" },
    non_examples = { "CC(C)=CC", "CC(C)=C(C)C(C)=O", "Cc1ccccc1C" },
}

group "styrene" {
    smarts = "[CX3;$(Cc);!$(C[$([CX3]=[OX1]),$(C#N),$(S(=O)=O),$([N+](=O)[O-])])]=[CX3;!$(C[$([CX3]=[OX1]),$(C#N),$(S(=O)=O),$([N+](=O)[O-])])]",
    parents = { "alkene" },
    examples = { "C=Cc1ccccc1", "CC=Cc1ccccc1", "C1Cc2ccccc2C=C1" },
    non_examples = { "C=CCc1ccccc1", "CC=C", "O=CC=Cc1ccccc1", "C#Cc1ccccc1" },
}

group "conjugated-diene" {
    name = "conjugated diene",
    smarts = "[CX3]=[CX3][CX3]=[CX3]",
    parents = { "alkene" },
    also = { "diene" },
    examples = { "C=CC=C", "C1CC=CC=C1", "C1C=CC=C1", "CC(=C)C(C)=C" },
    non_examples = { "C=CCC=C", "C=C=C", "c1ccccc1", "C=CC=O" },
}

group "acrylate" {
    name = "unsaturated ester",
    smarts = "[CX3;$(C[CX3]=[CX3])](=[OX1])([OX2;H0][#6])[CX3]=[CX3]",
    parents = { "ester", "michael-acceptor" },
    examples = { "C=CC(=O)OC", "CC=CC(=O)OCC", "CC(=C)C(=O)OC", "O=C1C=CCO1" },
    non_examples = { "C=CC(C)=O", "C=CCC(=O)OC", "C=COC(C)=O", "C=CC#N" },
}

group "nitroalkene" {
    smarts = "[CX3]=[CX3][NX3;+](=[OX1])[OX1;-]",
    parents = { "nitro", "michael-acceptor" },
    examples = { "C=C[N+](=O)[O-]", "O=[N+]([O-])C=Cc1ccccc1", "CC=C(C)[N+](=O)[O-]" },
    non_examples = { "C[N+](=O)[O-]", "O=[N+]([O-])c1ccccc1", "C=CC[N+](=O)[O-]" },
}

group "allene" {
    smarts = "[CX3]=[CX2]=[CX3]",
    examples = { "C=C=C", "CC=C=C", "C=C=CCO" },
    non_examples = { "C=CC=C", "CC#C", "C=C=O", "CN=C=O" },
}

group "terminal-alkyne" {
    name = "terminal alkyne",
    smarts = "[CX2;H1]#[CX2;$(C[#6])]",
    parents = { "alkyne" },
    examples = { "CC#C", "C#Cc1ccccc1", "C#CCO", { "C#CCCC#C", 2 } },
    non_examples = { "CC#CC", "CC#N", "C=CC", "C#C[Si](C)(C)C" },
}

group "internal-alkyne" {
    name = "internal alkyne",
    smarts = "[CX2;$(C[#6])]#[CX2;$(C[#6])]",
    parents = { "alkyne" },
    examples = { "CC#CC", "c1ccc(cc1)C#Cc1ccccc1", "CC#CCO" },
    non_examples = { "CC#C", "CC#C[Si](C)(C)C", "CC#N", "CC=CC" },
}

group "activated-alkyne" {
    name = "ynone or propiolate",
    smarts = "[CX2]#[CX2][CX3]=[OX1]",
    parents = { "alkyne" },
    examples = { "C#CC(C)=O", "COC(=O)C#C", { "COC(=O)C#CC(=O)OC", 2 }, "CC#CC=O" },
    non_examples = { "CC#CC", "C#CCC(C)=O", "C=CC(C)=O", "C#CCOC(C)=O" },
}

group "benzylic-ch" {
    name = "benzylic C-H",
    smarts = "[CX4;!H0;$(Cc);!$(C[!#6;!#1])]",
    also = { "benzylic position", "side chain", "alkyl side chain" },
    examples = { "Cc1ccccc1", "CCc1ccccc1", { "Cc1ccc(C)cc1", 2 }, { "C1CCc2ccccc2C1", 2 } },
    non_examples = { "CC(C)(C)c1ccccc1", "OCc1ccccc1", "FC(F)(F)c1ccccc1", "C=Cc1ccccc1" },
}

group "allylic-ch" {
    name = "allylic C-H",
    smarts = "[CX4;!H0;$(C[CX3]=[CX3]);!$(C[!#6;!#1])]",
    also = { "allylic position" },
    examples = { "CC=C", { "C1CCCC=C1", 2 }, "C=CCC=C", "C=CCCO" },
    non_examples = { "C=CC(C)(C)C", "C=CCO", "C=C", "CC=O" },
}

group "arene" {
    name = "benzene ring",
    smarts = "c1ccccc1",
    examples = { "c1ccccc1", "Cc1ccccc1", "Clc1ccccc1", { "c1ccc(cc1)-c1ccccc1", 2 } },
    non_examples = { "c1ccncc1", "C1CCCCC1", "C1=CCCCC1", "c1ccoc1" },
}

group "electron-rich-arene" {
    name = "electron-rich arene (O or N donor, free o or p CH)",
    smarts = "[c;$(c([$([OX2;!$(O[CX3]=[OX1]);!$(OS(=O)=O)]),$([NX3;+0;!$(N[CX3]=[O,S,N]);!$(NS(=O)=O);!$(N~[#8])])])[cH]),$(c1([$([OX2;!$(O[CX3]=[OX1]);!$(OS(=O)=O)]),$([NX3;+0;!$(N[CX3]=[O,S,N]);!$(NS(=O)=O);!$(N~[#8])])])cc[cH]cc1)]1ccccc1",
    parents = { "arene" },
    examples = { "COc1ccccc1", "Oc1ccccc1", "Nc1ccccc1", "CN(C)c1ccccc1", "C1Oc2ccccc2O1" },
    non_examples = { "c1ccccc1", "CC(=O)Nc1ccccc1", "CC(=O)Oc1ccccc1", "FC(F)(F)c1ccccc1" },
}

group "electron-poor-arene" {
    name = "electron-poor arene",
    smarts = "[c;$(c[N+](=O)[O-]),$(cC#N),$(c[CX3]=[OX1]),$(cC(F)(F)F),$(cS(=O)=O)]1[c;!$(c[$([OX2;!$(O[CX3]=[OX1]);!$(OS(=O)=O)]),$([NX3;+0;!$(N[CX3]=[O,S,N]);!$(NS(=O)=O);!$(N~[#8])])])][c;!$(c[$([OX2;!$(O[CX3]=[OX1]);!$(OS(=O)=O)]),$([NX3;+0;!$(N[CX3]=[O,S,N]);!$(NS(=O)=O);!$(N~[#8])])])][c;!$(c[$([OX2;!$(O[CX3]=[OX1]);!$(OS(=O)=O)]),$([NX3;+0;!$(N[CX3]=[O,S,N]);!$(NS(=O)=O);!$(N~[#8])])])][c;!$(c[$([OX2;!$(O[CX3]=[OX1]);!$(OS(=O)=O)]),$([NX3;+0;!$(N[CX3]=[O,S,N]);!$(NS(=O)=O);!$(N~[#8])])])][c;!$(c[$([OX2;!$(O[CX3]=[OX1]);!$(OS(=O)=O)]),$([NX3;+0;!$(N[CX3]=[O,S,N]);!$(NS(=O)=O);!$(N~[#8])])])]1",
    parents = { "arene" },
    examples = { "O=[N+]([O-])c1ccccc1", "COC(=O)c1ccccc1", "N#Cc1ccccc1", "FC(F)(F)c1ccccc1" },
    non_examples = { "c1ccccc1", "COc1ccc(cc1)C(C)=O", "Cc1ccccc1", "Clc1ccccc1" },
}

group "pyrrole" {
    smarts = "[nX3]1[c;R1][c;R1][c;R1][c;R1]1",
    examples = { "c1cc[nH]c1", "Cn1cccc1", "CC(=O)c1ccc[nH]1" },
    non_examples = { "c1ccc2[nH]ccc2c1", "C1CCNC1", "c1c[nH]cn1", "c1ccoc1" },
}

group "indole" {
    smarts = "[nX3]1[c;R1][c;R1]c2ccccc12",
    examples = { "c1ccc2[nH]ccc2c1", "Cn1ccc2ccccc12", "OC(=O)C(N)Cc1c[nH]c2ccccc12" },
    non_examples = { "C1Cc2ccccc2N1", "c1cc[nH]c1", "c1ccc2[nH]cnc2c1", "c1ccc2occc2c1" },
}

group "furan" {
    smarts = "o1[c;R1][c;R1][c;R1][c;R1]1",
    examples = { "c1ccoc1", "Cc1ccco1", "O=Cc1ccco1" },
    non_examples = { "C1CCOC1", "c1ccc2occc2c1", "c1ccsc1", "c1cocn1" },
}

group "thiophene" {
    smarts = "s1[c;R1][c;R1][c;R1][c;R1]1",
    examples = { "c1ccsc1", "Cc1cccs1", "CC(=O)c1cccs1" },
    non_examples = { "C1CCSC1", "c1ccc2sccc2c1", "c1ccoc1", "c1cscn1" },
}

group "pyridine" {
    name = "pyridine (also in quinolines)",
    smarts = "[nX2;+0]1ccccc1",
    examples = { "c1ccncc1", "Cc1ccccn1", "c1ccc2ncccc2c1", { "c1ccc(nc1)-c1ccccn1", 2 } },
    non_examples = { "C1CCNCC1", "c1ccccc1", "[O-][n+]1ccccc1", "c1cncnc1", "C[n+]1ccccc1" },
}

group "azole-nh" {
    name = "acidic N-H of an azole, indole or pyrrole",
    smarts = "[nX3;H1;+0;r5]",
    also = { "NH azole" },
    examples = { "c1cc[nH]c1", "c1ccc2[nH]ccc2c1", "c1c[nH]cn1", "c1nnn[nH]1" },
    non_examples = { "Cn1cccc1", "c1ccncc1", "C1CCNC1", "Oc1ccc[nH]c1=O" },
}

group "peroxide" {
    name = "peroxide or hydroperoxide",
    smarts = "[OX2][OX2]",
    examples = { "COOC", "CC(C)(C)OO", "CC(=O)OO", "C1CCOO1" },
    non_examples = { "CO", "COC", "OCCO", "O=O" },
}

group "beta-keto-ester" {
    name = "beta-keto ester",
    smarts = "[CX3;$(C([#6])[#6])](=[OX1])[CX4;!H0][CX3](=[OX1])[OX2;H0][#6]",
    parents = { "ketone", "ester", "acidic-ch" },
    also = { "β-keto ester", "beta-keto ester" },
    examples = { "CC(=O)CC(=O)OCC", "O=C1CCCC1C(=O)OC", "COC(=O)CC(=O)c1ccccc1" },
    non_examples = { "CC(=O)CCC(=O)OC", "CC(=O)C(=O)OC", "CC(=O)CC(C)=O", "CC(=O)C(C)(C)C(=O)OC" },
}

group "malonate" {
    name = "malonate diester",
    smarts = "[CX3](=[OX1])([OX2;H0][#6])[CX4;!H0][CX3](=[OX1])[OX2;H0][#6]",
    parents = { "ester", "acidic-ch" },
    examples = { "CCOC(=O)CC(=O)OCC", "COC(=O)C(C)C(=O)OC", "CCOC(=O)C(Cc1ccccc1)C(=O)OCC" },
    non_examples = { "COC(=O)CCC(=O)OC", "CCOC(=O)CC(O)=O", "CCOC(=O)C(C)(C)C(=O)OCC" },
}

-- Words that some transforms use for what they also attack; no class of conditions has a verdict on them.

group "methylarene" {
    smarts = "[CH3;$(Cc)]",
    also = { "methyl group" },
    examples = { "Cc1ccccc1", { "Cc1ccc(C)cc1", 2 }, "Cc1ccccn1" },
    non_examples = { "CCc1ccccc1", "COc1ccccc1", "CCC" },
}

group "phosphine" {
    smarts = "[PX3;+0;$(P([#6])([#6])[#6])]",
    examples = { "CP(C)C", "c1ccc(cc1)P(c1ccccc1)c1ccccc1", { "C(CP(C)C)P(C)C", 2 } },
    non_examples = { "O=P(C)(C)C", "COP(OC)OC", "C[P+](C)(C)C" },
}

group "thioamide" {
    smarts = "[NX3;+0][CX3;$(C[#6]),$([CX3;H1])]=[SX1]",
    examples = { "CC(N)=S", "NC(=S)c1ccccc1", "CNC(C)=S" },
    non_examples = { "CC(N)=O", "NC(N)=S", "COC(C)=S" },
}

group "iminium" {
    name = "iminium ion",
    smarts = "[NX3;+;$(N[#6])]=[CX3]",
    examples = { "C[N+](C)=C", "CC=[N+](C)C" },
    non_examples = { "CN=C", "C[N+](C)(C)C", "C[n+]1ccccc1" },
}

group "dihydropyridine" {
    name = "1,4-dihydropyridine",
    smarts = "[NX3;+0]1[CX3]=[CX3][CX4][CX3]=[CX3]1",
    examples = { "C1C=CNC=C1", "COC(=O)C1=C(C)NC(C)=C(C1)C(=O)OC" },
    non_examples = { "c1ccncc1", "C1CC=CNC1", "C1CCNCC1" },
}

group "alpha-hydroxy-ketone" {
    name = "alpha-hydroxy ketone",
    smarts = "[OX2;H1][CX4][CX3;$(C([#6])[#6])]=[OX1]",
    also = { "α-hydroxy ketone", "acyloin" },
    examples = { "CC(=O)CO", "CC(O)C(C)=O", "OC(C(=O)c1ccccc1)c1ccccc1" },
    non_examples = { "CC(=O)CCO", "OCC(O)=O", "COC(=O)CO" },
}

group "beta-amino-alcohol" {
    name = "beta-amino alcohol",
    smarts = "[OX2;H1][CX4][CX4][NX3;+0;!$(N[CX3]=[O,S,N]);!$(N[!#6])]",
    also = { "β-amino alcohol" },
    examples = { "NCCO", "CC(O)CNC", { "OCCNCCO", 2 } },
    non_examples = { "NCCCO", "CC(=O)NCCO", "COCCN" },
}

group "azinone" {
    name = "azinone (2- or 4-pyridone and the like)",
    smarts = "[n;H1]~[$(c=O)]",
    examples = { "O=c1cccc[nH]1", "O=c1ccnc[nH]1" },
    non_examples = { "Oc1ccccn1", "O=C1CCCCN1", "c1cc[nH]c1" },
}

-- Groups that are nucleophiles, acids or easily reduced although they look harmless.

group "amidine" {
    name = "amidine or guanidine",
    smarts = "[NX3;+0;!$(N-[C,S]=O);!$(N-[N+])][CX3;!$(C-S)]=[NX2;!$(N-[#7,#8]);!$(N-[C,S]=O);!$(N-C#N);!$(N-[N+])]",
    also = { "guanidine" },
    examples = { "CC(=N)N", { "NC(=N)N", 2 }, "NC(=N)c1ccccc1" },
    non_examples = { "CC(N)=O", "CC(N)=NO", "Nc1ccccn1" },
}

group "amidoxime" {
    smarts = "[NX3;+0][CX3]=[NX2][OX2;H1]",
    examples = { "CC(N)=NO", "NC(=NO)c1ccccc1" },
    non_examples = { "CC(C)=NO", "CC(N)=NOC", "CC(=O)NO" },
}

group "hydroxamic-acid" {
    name = "hydroxamic acid",
    smarts = "[OX2;H1][NX3][CX3]=[OX1]",
    examples = { "CC(=O)NO", "CN(O)C(=O)c1ccccc1" },
    non_examples = { "CC(=O)NOC", "CC(C)=NO", "CC(=O)O" },
}

group "azo" {
    name = "azo compound",
    smarts = "[#6][NX2]=[NX2][#6]",
    examples = { "c1ccc(cc1)N=Nc1ccccc1", "CN=NC" },
    non_examples = { "CNNC", "CC=NN", "[O-][N+](=Nc1ccccc1)c1ccccc1" },
}

group "sulfonic-acid" {
    name = "sulfonic acid",
    smarts = "[OX2;H1][SX4](=[OX1])(=[OX1])[#6]",
    examples = { "CS(=O)(=O)O", "OS(=O)(=O)c1ccccc1" },
    non_examples = { "COS(C)(=O)=O", "CS(N)(=O)=O", "CS(O)=O" },
}

group "phosphorus-acid" {
    name = "phosphonic acid or acid phosphate",
    smarts = "[OX2;H1][PX4]=[OX1]",
    examples = { { "CP(=O)(O)O", 2 }, "COP(=O)(O)OC" },
    non_examples = { "CP(=O)(OC)OC", "COP(OC)OC" },
}

group "phosphorus-ester" {
    name = "phosphonate or phosphate ester",
    smarts = "[PX4](=[OX1])[OX2][#6]",
    examples = { "CP(C)(=O)OC", { "COP(=O)(OC)OC", 3 } },
    non_examples = { "CP(=O)(O)O", "CP(C)(C)=O" },
}

group "thiourea" {
    name = "thiourea",
    smarts = "[SX1]=[CX3]([NX3])[NX3]",
    examples = { "NC(N)=S", "CNC(=S)Nc1ccccc1" },
    non_examples = { "CC(N)=S", "NC(N)=O", "CSC(N)=N" },
}

group "isothiourea" {
    name = "isothiourea",
    smarts = "[SX2;$(S[CX4])][CX3](=[NX2])[NX3]",
    examples = { "CSC(=N)N", "CSC(=NC)NC" },
    non_examples = { "NC(N)=S", "CSC(N)=O" },
}

group "cyanohydrin-ester" {
    name = "ester of a cyanohydrin",
    smarts = "[CX3](=[OX1])[OX2][CX4][CX2]#[NX1]",
    examples = { "CC(=O)OCC#N", "CC(=O)OC(C#N)c1ccccc1" },
    non_examples = { "CC(=O)OCCC#N", "OCC#N" },
}

group "nitrate-ester" {
    name = "nitrate ester",
    smarts = "[CX4][OX2][NX3+](=[OX1])[O-]",
    examples = { "CCO[N+](=O)[O-]" },
    non_examples = { "CC[N+](=O)[O-]", "CCON=O" },
}

group "thiocarbonyl" {
    name = "thiocarbonyl compound",
    smarts = "[#6]=[SX1]",
    examples = { "CC(=S)N", "NC(N)=S", "S=c1cc[nH]cc1" },
    non_examples = { "CC(=O)S", "CSC", "CS(C)=O" },
}
