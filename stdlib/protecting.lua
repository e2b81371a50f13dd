-- Protecting groups: what they guard, how they go on and come off, and what they stand.
--
-- `group` is the group that the protected compound shows, and its verdicts under the classes of conditions hold here, too;
-- where there is none, `like` names a group with the same verdicts. `survives`, `slow` and `attacked_by` list the classes
-- for which that is not so. `example` is a protected compound. From memory throughout; the books are Greene and Wuts,
-- Protective Groups in Organic Synthesis, unless said otherwise.

pack {
    name = "protecting",
    version = "0.1.0",
    licence = "CC0-1.0",
    about = "Protecting groups: what they guard, how they go on and come off, what they stand",
    needs = { "groups", "conditions" },
}

protecting "tms" {
    name = "trimethylsilyl ether",
    group = "tms-ether",
    example = "C[Si](C)(C)OCC1CCCCC1",
    guards = { "alcohol", "phenol" },
    installed_by = { "silylation" }, install_reagents = "TMSCl, Et3N or imidazole",
    removed_by = { "acid-aq-mild", "fluoride", "base-aq-mild" }, removal_reagents = "citric acid or K2CO3 in MeOH",
    remarks = "too labile for chromatography and long sequences",
    source = "Greene and Wuts; from memory",
}

protecting "tes" {
    name = "triethylsilyl ether",
    group = "tes-ether",
    example = "CC[Si](CC)(CC)OCC1CCCCC1",
    guards = { "alcohol" },
    installed_by = { "silylation" }, install_reagents = "TESCl, imidazole; TESOTf, 2,6-lutidine",
    removed_by = { "acid-aq-mild", "fluoride" }, removal_reagents = "AcOH-THF-H2O",
    remarks = "between TMS and TBS",
    source = "Greene and Wuts; from memory",
}

protecting "tbs" {
    name = "tert-butyldimethylsilyl ether",
    group = "tbs-ether",
    example = "CC(C)(C)[Si](C)(C)OCC1CCCCC1",
    guards = { "alcohol", "phenol" },
    installed_by = { "silylation" }, install_reagents = "TBSCl, imidazole; TBSOTf, 2,6-lutidine",
    removed_by = { "fluoride", "acid-aq-mild" }, removal_reagents = "Bu4NF; AcOH-THF-H2O; HF-pyridine",
    remarks = "the workhorse; phenolic TBS is lost to base",
    source = "Greene and Wuts; from memory",
}

protecting "tips" {
    name = "triisopropylsilyl ether",
    group = "tips-ether",
    example = "CC(C)[Si](OCC1CCCCC1)(C(C)C)C(C)C",
    guards = { "alcohol", "phenol" },
    installed_by = { "silylation" }, install_reagents = "TIPSOTf, 2,6-lutidine",
    removed_by = { "fluoride" }, removal_reagents = "Bu4NF",
    remarks = "stands mild acid and strong base",
    source = "Greene and Wuts; from memory",
}

protecting "tbdps" {
    name = "tert-butyldiphenylsilyl ether",
    group = "tbdps-ether",
    example = "CC(C)(C)[Si](OCC1CCCCC1)(c1ccccc1)c1ccccc1",
    guards = { "primary-alcohol", "secondary-alcohol" },
    installed_by = { "silylation" }, install_reagents = "TBDPSCl, imidazole",
    removed_by = { "fluoride" }, removal_reagents = "Bu4NF, AcOH buffer",
    remarks = "more acid-stable than TBS, less base-stable",
    source = "Greene and Wuts; from memory",
}

protecting "thp" {
    name = "tetrahydropyranyl ether",
    group = "thp-ether",
    example = "C(OC1CCCCO1)C1CCCCC1",
    guards = { "alcohol", "phenol" },
    installed_by = { "acid-hot-dry" }, install_reagents = "dihydropyran, PPTS, CH2Cl2, rt",
    removed_by = { "acid-aq-mild", "acid-dry-strong" }, removal_reagents = "PPTS, EtOH, 55 °C; TsOH, MeOH",
    remarks = "new stereocentre, mixtures of diastereomers",
    source = "Greene and Wuts; from memory",
}

protecting "mom" {
    name = "methoxymethyl ether",
    group = "mom-ether",
    example = "COCOCC1CCCCC1",
    guards = { "alcohol", "phenol" },
    installed_by = { "alkylation" }, install_reagents = "MOMCl, iPr2NEt",
    removed_by = { "acid-dry-strong", "acid-aq-strong" }, removal_reagents = "HCl, MeOH, 50 °C; TMSBr",
    remarks = "MOMCl is carcinogenic",
    source = "Greene and Wuts; from memory",
}

protecting "mem" {
    name = "methoxyethoxymethyl ether",
    like = "mom-ether",
    example = "COCCOCOCC1CCCCC1",
    guards = { "alcohol", "phenol" },
    installed_by = { "alkylation" }, install_reagents = "MEMCl, iPr2NEt",
    removed_by = { "lewis-acid", "acid-aq-strong" }, removal_reagents = "ZnBr2, CH2Cl2; TiCl4",
    remarks = "like MOM, more easily removed by Lewis acid",
    source = "Greene and Wuts; from memory",
}

protecting "sem" {
    name = "trimethylsilylethoxymethyl ether",
    like = "mom-ether",
    example = "C[Si](C)(C)CCOCOCC1CCCCC1",
    guards = { "alcohol", "phenol", "azole-nh" },
    installed_by = { "alkylation" }, install_reagents = "SEMCl, iPr2NEt or NaH",
    removed_by = { "fluoride", "acid-dry-strong" }, removal_reagents = "Bu4NF, 50 °C; TFA",
    attacked_by = { "fluoride" },
    remarks = "fluoride removal is slow",
    source = "Greene and Wuts; from memory",
}

protecting "benzyl" {
    name = "benzyl ether",
    group = "benzyl-ether",
    example = "C(OCc1ccccc1)C1CCCCC1",
    guards = { "alcohol", "phenol" },
    installed_by = { "alkylation" }, install_reagents = "NaH, BnBr; trichloroacetimidate with acid",
    removed_by = { "h2-pd", "birch", "bbr3" }, removal_reagents = "H2, Pd/C; Na, NH3; BCl3",
    remarks = "lost wherever an alkene is hydrogenated",
    source = "Greene and Wuts; from memory",
}

protecting "pmb" {
    name = "p-methoxybenzyl ether",
    group = "pmb-ether",
    example = "COc1ccc(COCC2CCCCC2)cc1",
    guards = { "alcohol", "phenol" },
    installed_by = { "alkylation" }, install_reagents = "NaH, PMBCl; trichloroacetimidate with acid",
    removed_by = { "ddq", "acid-dry-strong", "h2-pd" }, removal_reagents = "DDQ, CH2Cl2-H2O; CAN; TFA",
    remarks = "oxidative removal beside benzyl",
    source = "Greene and Wuts; from memory",
}

protecting "trityl" {
    name = "trityl ether",
    group = "trityl-ether",
    example = "C(OC(c1ccccc1)(c1ccccc1)c1ccccc1)C1CCCCC1",
    guards = { "primary-alcohol" },
    installed_by = { "alkylation" }, install_reagents = "TrCl, pyridine or Et3N, DMAP",
    removed_by = { "acid-aq-mild", "acid-dry-strong" }, removal_reagents = "HCO2H; AcOH-H2O; TFA 1 %",
    remarks = "selective for primary alcohols; adds 242 g/mol",
    source = "Greene and Wuts; from memory",
}

protecting "dmt" {
    name = "dimethoxytrityl ether",
    like = "trityl-ether",
    example = "COc1ccc(cc1)C(OCC1CCCCC1)(c1ccccc1)c1ccc(OC)cc1",
    guards = { "primary-alcohol" },
    installed_by = { "alkylation" }, install_reagents = "DMTCl, pyridine",
    removed_by = { "acid-aq-mild", "acid-dry-strong" }, removal_reagents = "Cl3CCO2H 3 %, CH2Cl2",
    remarks = "faster than trityl; nucleosides",
    source = "Greene and Wuts; from memory",
}

protecting "allyl-o" {
    name = "allyl ether",
    group = "allyl-ether",
    example = "C=CCOCC1CCCCC1",
    guards = { "alcohol", "phenol" },
    installed_by = { "alkylation" }, install_reagents = "NaH, allyl bromide",
    removed_by = { "pd0-allyl" }, removal_reagents = "Pd(PPh3)4, PhSiH3; isomerise then acid",
    remarks = "aryl allyl ethers rearrange on heating",
    source = "Greene and Wuts; from memory",
}

protecting "tbu-o" {
    name = "tert-butyl ether",
    group = "tert-butyl-ether",
    example = "CC(C)(C)OCC1CCCCC1",
    guards = { "alcohol" },
    installed_by = { "acid-hot-dry" }, install_reagents = "isobutene, acid (cat)",
    removed_by = { "acid-dry-strong", "lewis-acid", "bbr3" }, removal_reagents = "neat TFA",
    remarks = "serine and tyrosine side chains",
    source = "Greene and Wuts; from memory",
}

protecting "methyl-ar" {
    name = "aryl methyl ether",
    group = "aryl-methyl-ether",
    example = "COc1ccc(C)cc1",
    guards = { "phenol" },
    installed_by = { "alkylation" }, install_reagents = "MeI or Me2SO4, K2CO3",
    removed_by = { "bbr3", "thiolate" }, removal_reagents = "BBr3; EtSNa, DMF, heat",
    remarks = "very robust; removal is harsh",
    source = "Greene and Wuts; from memory",
}

protecting "acetate" {
    name = "acetate",
    group = "acetate-ester",
    example = "CC(=O)OCC1CCCCC1",
    guards = { "alcohol", "phenol" },
    installed_by = { "acylation" }, install_reagents = "Ac2O, pyridine, DMAP (cat)",
    removed_by = { "base-aq-mild", "base-aq-strong" }, removal_reagents = "K2CO3, MeOH; NaOMe, MeOH",
    remarks = "may migrate to a neighbouring OH",
    source = "Greene and Wuts; from memory",
}

protecting "benzoate" {
    name = "benzoate",
    group = "benzoate-ester",
    example = "O=C(OCC1CCCCC1)c1ccccc1",
    guards = { "alcohol" },
    installed_by = { "acylation" }, install_reagents = "BzCl, pyridine",
    removed_by = { "base-aq-strong", "alkoxide" }, removal_reagents = "NaOMe, MeOH",
    remarks = "migrates less than acetate; neighbouring group in glycosylation",
    source = "Greene and Wuts; from memory",
}

protecting "pivalate" {
    name = "pivalate",
    group = "pivalate-ester",
    example = "CC(C)(C)C(=O)OCC1CCCCC1",
    guards = { "primary-alcohol" },
    installed_by = { "acylation" }, install_reagents = "PivCl, pyridine",
    removed_by = { "dibal", "lialh4", "alkoxide" }, removal_reagents = "DIBAL, -78 °C; NaOMe, MeOH, reflux",
    remarks = "selective for primary alcohols",
    source = "Greene and Wuts; from memory",
}

protecting "acetonide" {
    name = "acetonide of a 1,2- or 1,3-diol",
    group = "acetonide",
    example = "CC1(C)OCC(CC)O1",
    guards = { "vicinal-diol" },
    installed_by = { "acid-hot-dry" }, install_reagents = "Me2C(OMe)2, TsOH or CSA (cat), rt",
    removed_by = { "acid-aq-mild", "acid-dry-strong" }, removal_reagents = "AcOH-H2O; HCl, MeOH",
    remarks = "1,2 before 1,3",
    source = "Greene and Wuts; from memory",
}

protecting "benzylidene" {
    name = "benzylidene acetal",
    group = "benzylidene-acetal",
    example = "C1COC(OC1)c1ccccc1",
    guards = { "vicinal-diol" },
    installed_by = { "acid-hot-dry" }, install_reagents = "PhCH(OMe)2, CSA (cat)",
    removed_by = { "acid-aq-mild", "h2-pd" }, removal_reagents = "AcOH-H2O; H2, Pd/C; DIBAL opens to a mono-benzyl ether",
    remarks = "1,3 before 1,2 in sugars",
    source = "Greene and Wuts; from memory",
}

protecting "methylene" {
    name = "methylenedioxy of a catechol",
    group = "methylenedioxyarene",
    example = "Cc1ccc2OCOc2c1",
    guards = { "hydroquinone" },
    installed_by = { "alkylation" }, install_reagents = "CH2Br2 or CH2I2, Cs2CO3, DMF",
    removed_by = { "bbr3" }, removal_reagents = "BCl3 or BBr3",
    remarks = "very robust",
    source = "Greene and Wuts; from memory",
}

protecting "carbonate" {
    name = "cyclic carbonate of a diol",
    group = "carbonate",
    example = "CCC1COC(=O)O1",
    guards = { "vicinal-diol" },
    installed_by = { "acylation" }, install_reagents = "triphosgene or CDI, pyridine",
    removed_by = { "base-aq-strong" }, removal_reagents = "NaOH or K2CO3, MeOH",
    remarks = "stands acid, not base",
    source = "Greene and Wuts; from memory",
}

protecting "dioxolane" {
    name = "dioxolane",
    group = "dioxolane",
    example = "C1CCC2(CC1)OCCO2",
    guards = { "ketone", "aldehyde" },
    installed_by = { "acid-hot-dry" }, install_reagents = "HOCH2CH2OH, TsOH (cat), Dean-Stark",
    removed_by = { "acid-aq-mild", "acid-aq-strong" }, removal_reagents = "HCl 2 M, THF; PPTS, acetone-H2O",
    remarks = "stands bases, hydrides and organometallics",
    source = "Greene and Wuts; from memory",
}

protecting "dimethyl-acetal" {
    name = "dimethyl acetal",
    group = "aldehyde-acetal",
    example = "COC(OC)C1CCCCC1",
    guards = { "aldehyde" },
    installed_by = { "acid-hot-dry" }, install_reagents = "HC(OMe)3, MeOH, TsOH (cat)",
    removed_by = { "acid-aq-mild", "acid-dry-strong" }, removal_reagents = "TFA-H2O; HCl, THF",
    remarks = "more labile than dioxolane",
    source = "Greene and Wuts; from memory",
}

protecting "dithiane" {
    name = "1,3-dithiane",
    group = "dithioacetal",
    example = "C1CSC(SC1)C1CCCCC1",
    guards = { "ketone", "aldehyde" },
    installed_by = { "lewis-acid" }, install_reagents = "HS(CH2)3SH, BF3-OEt2",
    removed_by = { "br2", "ddq" }, removal_reagents = "PhI(O2CCF3)2, MeCN-H2O; NBS, acetone-H2O; HgCl2, CaCO3",
    remarks = "stands acid; its C-H is lithiated; poisons palladium",
    source = "Greene and Wuts; from memory",
}

protecting "methyl-ester" {
    name = "methyl ester",
    group = "methyl-ester",
    example = "COC(=O)C1CCCCC1",
    guards = { "carboxylic-acid" },
    installed_by = { "acid-hot-dry", "alkylation" }, install_reagents = "MeOH, H2SO4 or SOCl2; MeI, K2CO3; TMSCHN2",
    removed_by = { "base-aq-strong" }, removal_reagents = "LiOH, THF-H2O",
    remarks = "alpha centre may epimerise",
    source = "Greene and Wuts; from memory",
}

protecting "ethyl-ester" {
    name = "ethyl ester",
    group = "ethyl-ester",
    example = "CCOC(=O)C1CCCCC1",
    guards = { "carboxylic-acid" },
    installed_by = { "acid-hot-dry", "alkylation" }, install_reagents = "EtOH, H2SO4; EtI, K2CO3",
    removed_by = { "base-aq-strong" }, removal_reagents = "NaOH, EtOH-H2O",
    remarks = "a little slower than methyl",
    source = "Greene and Wuts; from memory",
}

protecting "tbu-ester" {
    name = "tert-butyl ester",
    group = "tert-butyl-ester",
    example = "CC(C)(C)OC(=O)C1CCCCC1",
    guards = { "carboxylic-acid" },
    installed_by = { "acylation" }, install_reagents = "Boc2O, DMAP, tBuOH; isobutene with acid; DCC, tBuOH",
    removed_by = { "acid-dry-strong" }, removal_reagents = "CF3CO2H, CH2Cl2; HCl, dioxane",
    remarks = "lost together with Boc",
    source = "Greene and Wuts; from memory",
}

protecting "benzyl-ester" {
    name = "benzyl ester",
    group = "benzyl-ester",
    example = "O=C(OCc1ccccc1)C1CCCCC1",
    guards = { "carboxylic-acid" },
    installed_by = { "alkylation", "acylation" }, install_reagents = "BnBr, Cs2CO3; BnOH, DCC, DMAP",
    removed_by = { "h2-pd", "base-aq-strong" }, removal_reagents = "H2, Pd/C",
    remarks = "lost together with Cbz",
    source = "Greene and Wuts; from memory",
}

protecting "allyl-ester" {
    name = "allyl ester",
    group = "allyl-ester",
    example = "C=CCOC(=O)C1CCCCC1",
    guards = { "carboxylic-acid" },
    installed_by = { "alkylation" }, install_reagents = "allyl bromide, K2CO3",
    removed_by = { "pd0-allyl", "base-aq-strong" }, removal_reagents = "Pd(PPh3)4, PhSiH3 or morpholine",
    remarks = "lost together with Alloc",
    source = "Greene and Wuts; from memory",
}

protecting "boc" {
    name = "tert-butoxycarbonyl",
    group = "boc-amine",
    example = "CC(C)(C)OC(=O)NC1CCCCC1",
    guards = { "primary-amine", "secondary-amine", "aniline", "azole-nh" },
    installed_by = { "acylation" }, install_reagents = "Boc2O, NaHCO3 or Et3N; DMAP for weak nucleophiles",
    removed_by = { "acid-dry-strong" }, removal_reagents = "CF3CO2H, CH2Cl2; HCl, dioxane",
    remarks = "stands base and hydrogenation",
    source = "Greene and Wuts; from memory",
}

protecting "cbz" {
    name = "benzyloxycarbonyl",
    group = "cbz-amine",
    example = "O=C(NC1CCCCC1)OCc1ccccc1",
    guards = { "primary-amine", "secondary-amine", "aniline" },
    installed_by = { "acylation" }, install_reagents = "CbzCl, NaHCO3",
    removed_by = { "h2-pd", "birch", "bbr3" }, removal_reagents = "H2, Pd/C; HBr, AcOH; TMSI",
    remarks = "stands mild acid and base",
    source = "Greene and Wuts; from memory",
}

protecting "fmoc" {
    name = "fluorenylmethoxycarbonyl",
    group = "fmoc-amine",
    example = "O=C(NC1CCCCC1)OCC1c2ccccc2-c2ccccc21",
    guards = { "primary-amine", "secondary-amine" },
    installed_by = { "acylation" }, install_reagents = "FmocOSu, NaHCO3",
    removed_by = { "amine-rt" }, removal_reagents = "piperidine 20 %, DMF",
    remarks = "stands acid, not base or fluoride",
    source = "Greene and Wuts; from memory",
}

protecting "alloc" {
    name = "allyloxycarbonyl",
    group = "alloc-amine",
    example = "C=CCOC(=O)NC1CCCCC1",
    guards = { "primary-amine", "secondary-amine" },
    installed_by = { "acylation" }, install_reagents = "AllocCl, pyridine",
    removed_by = { "pd0-allyl" }, removal_reagents = "Pd(PPh3)4, PhSiH3",
    remarks = "orthogonal to Boc and Fmoc",
    source = "Greene and Wuts; from memory",
}

protecting "troc" {
    name = "trichloroethoxycarbonyl",
    like = "carbamate",
    example = "O=C(NC1CCCCC1)OCC(Cl)(Cl)Cl",
    guards = { "primary-amine", "secondary-amine" },
    installed_by = { "acylation" }, install_reagents = "TrocCl, pyridine",
    removed_by = { "zn-acid" }, removal_reagents = "Zn, AcOH",
    slow = { "h2-pd" },
    attacked_by = { "base-aq-strong", "organolithium", "zn-acid", "birch", "tin-radical" },
    remarks = "reductive removal beside Boc and Cbz",
    source = "Greene and Wuts; from memory",
}

protecting "teoc" {
    name = "trimethylsilylethoxycarbonyl",
    like = "carbamate",
    example = "C[Si](C)(C)CCOC(=O)NC1CCCCC1",
    guards = { "primary-amine", "secondary-amine" },
    installed_by = { "acylation" }, install_reagents = "TeocOSu or TeocONp, Et3N",
    removed_by = { "fluoride", "acid-dry-strong" }, removal_reagents = "Bu4NF or CsF",
    attacked_by = { "acid-dry-strong", "lewis-acid", "fluoride" },
    remarks = "removed by fluoride",
    source = "Greene and Wuts; from memory",
}

protecting "phth" {
    name = "phthaloyl",
    group = "phthalimide",
    example = "O=C1N(C2CCCCC2)C(=O)c2ccccc12",
    guards = { "primary-amine" },
    installed_by = { "heat-200" }, install_reagents = "phthalic anhydride, AcOH reflux or toluene with Et3N",
    removed_by = { "hydrazine" }, removal_reagents = "N2H4, EtOH; MeNH2",
    remarks = "guards both N-H; stands acid",
    source = "Greene and Wuts; from memory",
}

protecting "tosyl" {
    name = "p-toluenesulfonyl",
    group = "tosylamide",
    example = "Cc1ccc(cc1)S(=O)(=O)NC1CCCCC1",
    guards = { "primary-amine", "secondary-amine", "aniline", "azole-nh" },
    installed_by = { "acylation" }, install_reagents = "TsCl, Et3N or pyridine",
    removed_by = { "birch" }, removal_reagents = "Na, naphthalene; Mg, MeOH; SmI2",
    remarks = "very robust; removal is harsh",
    source = "Greene and Wuts; from memory",
}

protecting "nosyl" {
    name = "nitrobenzenesulfonyl",
    group = "nosylamide",
    example = "O=S(=O)(NC1CCCCC1)c1ccccc1[N+](=O)[O-]",
    guards = { "primary-amine", "secondary-amine" },
    installed_by = { "acylation" }, install_reagents = "NsCl, Et3N",
    removed_by = { "thiolate" }, removal_reagents = "PhSH, K2CO3, DMF",
    remarks = "makes N-H acidic: Fukuyama alkylation",
    source = "Greene and Wuts; from memory",
}

protecting "tfa-n" {
    name = "trifluoroacetyl",
    group = "trifluoroacetamide",
    example = "O=C(NC1CCCCC1)C(F)(F)F",
    guards = { "primary-amine", "secondary-amine" },
    installed_by = { "acylation" }, install_reagents = "(CF3CO)2O, Et3N or CF3CO2Et",
    removed_by = { "base-aq-mild", "base-aq-strong" }, removal_reagents = "K2CO3, MeOH-H2O",
    remarks = "removed by weak base",
    source = "Greene and Wuts; from memory",
}

protecting "acetyl-n" {
    name = "acetyl (amide)",
    group = "secondary-amide",
    example = "CC(=O)NC1CCCCC1",
    guards = { "primary-amine", "primary-aniline", "secondary-amine" },
    installed_by = { "acylation" }, install_reagents = "Ac2O, pyridine",
    removed_by = { "acid-aq-strong" }, removal_reagents = "HCl 6 M, reflux",
    remarks = "for anilines before nitration or bromination",
    source = "Greene and Wuts; from memory",
}

protecting "benzyl-n" {
    name = "N-benzyl",
    group = "n-benzyl-amine",
    example = "C(NC1CCCCC1)c1ccccc1",
    guards = { "primary-amine", "secondary-amine" },
    installed_by = { "alkylation", "reductive-amination" }, install_reagents = "BnBr, K2CO3; PhCHO, NaBH(OAc)3",
    removed_by = { "h2-pd", "birch" }, removal_reagents = "H2, Pd(OH)2/C; 1-chloroethyl chloroformate",
    remarks = "the nitrogen stays basic",
    source = "Greene and Wuts; from memory",
}

protecting "benzhydrylidene" {
    name = "diphenylmethylene imine",
    like = "imine",
    example = "C(=NC1CCCCC1)(c1ccccc1)c1ccccc1",
    guards = { "primary-amine" },
    installed_by = { "amine-heat" }, install_reagents = "Ph2C=NH or Ph2CO with acid",
    removed_by = { "acid-aq-mild", "h2-pd" }, removal_reagents = "HCl 1 M, THF; NH2OH",
    remarks = "glycine equivalents, ammonia surrogate in coupling",
    source = "Greene and Wuts; from memory",
}

protecting "tms-alkyne" {
    name = "C-trimethylsilyl alkyne",
    group = "alkynyl-silane",
    example = "C[Si](C)(C)C#CC1CCCCC1",
    guards = { "terminal-alkyne" },
    installed_by = { "base-hindered" }, install_reagents = "BuLi or LiHMDS, TMSCl",
    removed_by = { "base-aq-mild", "fluoride" }, removal_reagents = "K2CO3, MeOH; Bu4NF",
    remarks = "stands Pd coupling better than free alkyne",
    source = "Greene and Wuts; from memory",
}

protecting "tips-alkyne" {
    name = "C-triisopropylsilyl alkyne",
    like = "alkyne",
    example = "CC(C)[Si](C#CC1CCCCC1)(C(C)C)C(C)C",
    guards = { "terminal-alkyne" },
    installed_by = { "base-hindered" }, install_reagents = "BuLi or LiHMDS, TIPSCl",
    removed_by = { "fluoride" }, removal_reagents = "Bu4NF",
    slow = { "amine-heat", "thiolate", "borane", "h2-lindlar", "birch", "br2" },
    attacked_by = { "wolff-kishner", "fluoride" },
    remarks = "orthogonal to C-TMS by carbonate",
    source = "Greene and Wuts; from memory",
}

protecting "trityl-s" {
    name = "S-trityl",
    like = "trityl-ether",
    example = "C(SC(c1ccccc1)(c1ccccc1)c1ccccc1)C1CCCCC1",
    guards = { "thiol" },
    installed_by = { "acid-hot-dry", "alkylation" }, install_reagents = "TrOH, TFA; TrCl, pyridine",
    removed_by = { "acid-dry-strong" }, removal_reagents = "TFA, iPr3SiH",
    attacked_by = { "mcpba", "tempo", "br2" },
    remarks = "needs a cation scavenger; iodine gives the disulfide",
    source = "Greene and Wuts; from memory",
}

protecting "pinacol-b" {
    name = "pinacol boronate",
    group = "boronic-ester",
    example = "CC1(C)OB(OC1(C)C)C1CCCCC1",
    guards = { "boronic-acid" },
    installed_by = { "acid-hot-dry" }, install_reagents = "pinacol, MgSO4",
    removed_by = { "periodate" }, removal_reagents = "NaIO4, THF-H2O, then HCl",
    remarks = "couples like the acid under basic conditions",
    source = "Greene and Wuts; from memory",
}
