-- Aldehydes, ketones and their nitrogen derivatives.
-- Yields are typical ranges and sources stand from memory unless a source says otherwise.

pack {
    name = "carbonyls",
    version = "0.1.0",
    licence = "CC0-1.0",
    about = "Aldehydes, ketones and their nitrogen derivatives",
    needs = { "synthons" },
}

-- Whether the diol that would rearrange has two alike halves; others give mixtures.
local PINACOL = rewrite("[C;X4;H0:1]([C;X4:3])([C;X4:4])([C;X4:5])[C;X3:2](=[O;X1:6])[C;X4:7]>>" ..
    "[C;X4;H0:1]([C;X4:3])([C;X4:4])([O;X2;H1])[C;X4;H0:2]([C;X4:5])([O;X2;H1:6])[C;X4:7]")
local PINACOL_DIOL = pattern "[CX4;H0]([OX2H])[CX4;H0][OX2H]"
local function comes_from_symmetrical_diol(m)
    for _, pieces in ipairs(PINACOL:apply(m.molecule)) do
        local atoms = pieces[1]:atoms()
        for _, hit in ipairs(pieces[1]:find(PINACOL_DIOL)) do
            if atoms[hit[1]].symmetry == atoms[hit[3]].symmetry then return true end
        end
    end
    return false
end

interconversion "dess-martin-ketone" {
    about = "Dess-Martin ketone oxidation; no epimerisation; neutral",
    rxno = "RXNO:0000576",
    target = "[#6;!$([CX4]-[OX2H1]);!$(C=[O,N]):3][C;X3;H0;!$(C1C=CC(=O)C=C1);!$(C1C(=O)C=CC=C1);!r3:1](=[O;X1:2])[#6;!$([CX4]-[OX2H1]);!$(C=[O,N]):4]",
    from = "[#6:3][C;X4;H1:1]([O;X2;H1:2])[#6:4]",
    conditions = "swern-dmp",
    also_attacks = { "free alcohol", "thiol", "thioether", "primary amine", "secondary amine" },
    recipe = "Dess-Martin periodinane, CH2Cl2, 0 °C to rt; also: Swern, TEMPO-NaOCl, IBX",
    yield = { 80, 95 },
    cautions = { "Dess-Martin periodinane" },
    source = "D. B. Dess and J. C. Martin, J. Org. Chem. 1983, 48, 4155; from memory",
    example { "CC(C)(C)OC(=O)N1CCCC(=O)C1", from = { "CC(C)(C)OC(=O)N1CCCC(O)C1" } },
    example { "O=C1CCCCC1", from = { "OC1CCCCC1" } },
    refuse { "CC(=O)C(C)O" }, -- a diol is cleaved, or goes on to the diketone
    refuse { "COC(C)=O" }, -- ester carbonyl does not come from an alcohol
}

interconversion "manganese-dioxide-oxidation" {
    about = "Allylic or benzylic alcohol oxidation with manganese dioxide; allylic and benzylic before " ..
        "saturated alcohols; E/Z kept",
    target = "[#6;$(c),$([C;X3]=[C;X3]):1][C;X3;H1:2]=[O;X1:3]",
    from = "[#6:1][C;X4;H2:2][O;X2;H1:3]",
    conditions = "mno2",
    also_attacks = { "thiol", "hydroquinone", "aniline" },
    recipe = "MnO2 (activated, 5-10 equiv), CH2Cl2, rt",
    yield = { 80, 97 },
    cautions = { "manganese dioxide" },
    source = "Carey and Sundberg, Advanced Organic Chemistry, Part B; from memory",
    example { "O=Cc1cc(CCO)ccc1F", from = { "OCc1cc(CCO)ccc1F" } },
    example { "O=Cc1ccccc1", from = { "OCc1ccccc1" } },
    example { "O=C/C=C/c1ccccc1", from = { "OC/C=C/c1ccccc1" } },
    refuse { "O=CCCc1ccccc1" }, -- saturated aldehyde: MnO2 leaves saturated alcohols alone
}

interconversion "oppenauer-oxidation" {
    about = "Oppenauer oxidation (homoallylic steroid alcohol to enone); C=C moves into conjugation",
    rxno = "RXNO:0000047",
    target = "[C;X3;H0;R:1](=[O;X1:2])[C;X3;H1;R:3]=[C;X3;H0;R:4][C;X4;H2;R:6]",
    from = "[C;X4;H1;R:1]([O;X2;H1:2])[C;X4;H2;R:3][C;X3;H0;R:4]=[C;X3;H1;R:6]",
    conditions = "alkoxide",
    also_attacks = { "aldehyde", "secondary amine" },
    recipe = "Al(OiPr)3, cyclohexanone or acetone, toluene, reflux",
    yield = { 70, 90 },
    source = "March's Advanced Organic Chemistry; from memory",
    example { "O=C1CC[C@@]2(C)C(=C1)CC[C@H]1[C@@H]3CCC(=O)[C@@]3(C)CC[C@@H]12", from = { "OC1CC[C@@]2(C)C(=CC[C@H]3[C@@H]4CCC(=O)[C@@]4(C)CC[C@@H]32)C1" } },
    refuse { "O=C1C=CCCC1" }, -- no substituent and CH2 pair to take the migrating C=C
}

interconversion "ozonolysis-ketone" {
    about = "Ozonolysis of a methylene compound to a ketone (alkene oxidative cleavage); both alkene " ..
        "carbons become C=O; the more electron-rich alkene first",
    rxno = "RXNO:0000344",
    target = "[C;X4;H2,H3:1][C;X3;H0;$(C([CH3])[CX4;H0,H1]),$([C;R]([CH2;R])[CH2;R]):2]([C;X4:4])=[O;X1]",
    from = "[#6:1][C;X3;H0:2]([#6:4])=[C;X3;H2]",
    conditions = "ozone",
    also_attacks = { "alkene", "alkyne", "thioether", "thiol", "primary amine", "secondary amine",
        "tertiary amine", "enol ether" },
    recipe = "O3, CH2Cl2-MeOH, -78 °C, then Me2S; also: OsO4 (cat), NaIO4 (Lemieux-Johnson)",
    yield = { 65, 90 },
    cautions = { "ozone", "ozonides" },
    source = "Clayden, Greeves, Warren, Organic Chemistry; from memory",
    example { "CC(=O)[C@H]1CC[C@]2(C)O[C@@H]2C1", from = { "CC(=C)[C@H]1CC[C@]2(C)O[C@@H]2C1" } },
    example { "O=C1CCCCC1", from = { "C=C1CCCCC1" } },
    refuse { "CC(=O)OC" }, -- ester carbonyl
}

interconversion "ozonolysis-cyclohexene" {
    about = "Ozonolysis of a cyclohexene to a 1,6-dicarbonyl compound (alkene oxidative cleavage); " ..
        "reconnection of a 1,6-dicarbonyl compound",
    rxno = "RXNO:0000344",
    target = "[C;X3;H1:1](=[O;X1])[C;X4:2][C;X4:3][C;X4:4][C;X4:5][C;X3;H0:6](=[O;X1])[#6:7]",
    from = "[C;X3;H1:1]1[C;X4:2][C;X4:3][C;X4:4][C;X4:5][C;X3;H0:6]([#6:7])=1",
    conditions = "ozone",
    also_attacks = { "alkene", "alkyne", "thioether", "thiol", "primary amine", "secondary amine",
        "tertiary amine" },
    recipe = "O3, CH2Cl2, -78 °C, then Me2S",
    yield = { 65, 88 },
    cautions = { "ozone", "ozonides" },
    source = "Warren and Wyatt, Organic Synthesis: The Disconnection Approach; from memory",
    example { "CC(=O)CCCCC=O", from = { "CC1=CCCCC1" } },
    example { "O=CCCCCC(=O)c1ccccc1", from = { "C1=C(CCCC1)c1ccccc1" } },
    refuse { "CC(=O)CCCC=O" }, -- 1,5-dicarbonyl: would need a cyclopentene
}

interconversion "glycol-cleavage" {
    about = "Malaprade reaction (glycol cleavage); neighbouring centres kept; only vicinal diols",
    rxno = "RXNO:0000650",
    target = "[C;X4;$(C-[#7,#8]):1][C;X3;H1:2]=[O;X1:3]",
    from = "[#6:1][C;X4;H1:2]([O;X2;H1:3])[C;X4;H2][O;X2;H1]",
    conditions = "periodate",
    also_attacks = { "thioether", "thiol", "hydroquinone", "vicinal diol" },
    recipe = "NaIO4, THF-H2O or SiO2-CH2Cl2, rt; also: Pb(OAc)4",
    yield = { 80, 97 },
    cautions = { "sodium periodate" },
    source = "Clayden, Greeves, Warren, Organic Chemistry; from memory",
    example { "O=CC1COC(C)(C)O1", from = { "OCC(O)C1COC(C)(C)O1" } },
    example { "O=C[C@H]1COC(C)(C)O1", from = { "OCC(O)[C@H]1COC(C)(C)O1" } },
    refuse { "CC(C)=O" }, -- ketone needs a tertiary carbinol in the diol
    refuse { "CCCCC=O" }, -- kept to α-alkoxy and α-amino aldehydes
}

interconversion "alkyne-hydroboration-aldehyde" {
    about = "Hydroboration-oxidation of a terminal alkyne; anti-Markovnikov: aldehyde",
    rxno = "RXNO:0000293",
    target = "[#6:1][C;X4;H2:2][C;X3;H1:3]=[O;X1]",
    from = "[#6:1][C;X2;H0:2]#[C;X2;H1:3]",
    conditions = "borane",
    also_attacks = { "alkyne", "alkene", "aldehyde", "ketone", "free acid" },
    recipe = "Cy2BH or Sia2BH, THF, 0 °C, then H2O2, pH 7 buffer",
    yield = { 65, 88 },
    cautions = { "hydrogen peroxide" },
    source = "Clayden, Greeves, Warren, Organic Chemistry; from memory",
    example { "O=CCCCO[Si](C)(C)C(C)(C)C", from = { "C#CCCO[Si](C)(C)C(C)(C)C" } },
    example { "CCCCCC=O", from = { "CCCCC#C" } },
    refuse { "CC(=O)CC" }, -- anti-Markovnikov addition gives the aldehyde
}

interconversion "wacker-tsuji-oxidation" {
    about = "Wacker-Tsuji oxidation; Markovnikov: methyl ketone; terminal before internal alkenes",
    rxno = "RXNO:0000130",
    target = "[C;X4:1][C;X3;H0:2](=[O;X1])[C;X4;H3:3]",
    from = "[C;X4:1][C;X3;H1:2]=[C;X3;H2:3]",
    conditions = "acid-aq-mild",
    also_attacks = { "alkene", "thiol", "thioether", "terminal alkyne", "primary amine" },
    recipe = "PdCl2 (cat), CuCl, O2, DMF-H2O, rt",
    yield = { 65, 88 },
    cautions = { "N,N-dimethylformamide" },
    source = "J. Tsuji, Synthesis 1984, 369; from memory",
    example { "CC(=O)CCCCC(=O)OCc1ccccc1", from = { "C=CCCCCC(=O)OCc1ccccc1" } },
    example { "CCCCCCCCC(C)=O", from = { "CCCCCCCCC=C" } },
    refuse { "CC(=O)c1ccccc1" }, -- styrenes give mixtures with the aldehyde
}

interconversion "aldehyde-from-weinreb-amide" {
    about = "Weinreb amide to aldehyde reduction; no over-reduction (chelate); alpha centre kept",
    target = "[#6:1][C;X3;H1:2]=[O;X1:3]",
    from = "[#6:1][C;X3;H0:2](=[O;X1:3])[N;X3]([C;H3])[O;X2][C;H3]",
    conditions = "lialh4",
    also_attacks = { "aldehyde", "ketone", "ester", "acyl halide", "epoxide", "free acid" },
    recipe = "LiAlH4 or DIBAL-H, THF, -78 to 0 °C",
    yield = { 75, 95 },
    cautions = { "lithium aluminium hydride" },
    source = "J.-A. Fehrentz and B. Castro, Synthesis 1983, 676; from memory",
    example { "O=C[C@H](CC(C)C)NC(=O)OC(C)(C)C", from = { "CON(C)C(=O)[C@H](CC(C)C)NC(=O)OC(C)(C)C" } },
    example { "O=CCCc1ccccc1", from = { "CON(C)C(=O)CCc1ccccc1" } },
    refuse { "CC(C)=O" }, -- ketone carbon bears no H
}

interconversion "rosenmund-reduction" {
    about = "Rosenmund reduction; stops at the aldehyde with a poisoned catalyst",
    rxno = "RXNO:0000136",
    target = "[#6:1][C;X3;H1:2]=[O;X1:3]",
    from = "[#6:1][C;X3;H0:2](=[O;X1:3])[Cl;X1]",
    conditions = "h2-pd",
    also_attacks = { "alkene", "alkyne", "nitro", "azide", "benzyl ether", "Cbz amine" },
    recipe = "H2, Pd/BaSO4, quinoline-S, toluene or xylene, reflux; also: LiAlH(OtBu)3, -78 °C",
    yield = { 65, 85 },
    cautions = { "hydrogen" },
    source = "Kürti and Czakó, Strategic Applications of Named Reactions in Organic Synthesis; from memory",
    example { "COc1cc(C=O)cc(OC)c1OC", from = { "COc1cc(C(=O)Cl)cc(OC)c1OC" } },
    example { "O=Cc1ccc2ccccc2c1", from = { "O=C(Cl)c1ccc2ccccc2c1" } },
    refuse { "CC(C)=O" }, -- ketone carbon bears no H
}

interconversion "aldehyde-from-dimethyl-acetal" {
    about = "Hydrolysis of an acetal; no change elsewhere",
    target = "[C;X4;$(C-[#7,#8,#16]),$(C-[CX3]=O):1][C;X3;H1:2]=[O;X1]",
    from = "[#6:1][C;X4;H1:2]([O;X2][C;H3])[O;X2][C;H3]",
    conditions = "acid-aq-mild",
    also_attacks = { "acetal", "silyl ether", "tert-butyl ester", "Boc amine", "enol ether", "epoxide",
        "trityl ether" },
    recipe = "HCl or TsOH, acetone-H2O, rt; also: HCO2H; I2, acetone; diethyl acetal",
    yield = { 80, 97 },
    cautions = { "hydrochloric acid" },
    source = "Clayden, Greeves, Warren, Organic Chemistry; from memory",
    example { "O=CCNC(=O)c1ccccc1", from = { "COC(OC)CNC(=O)c1ccccc1" } },
    example { "O=CCN1CCOCC1", from = { "COC(OC)CN1CCOCC1" } },
    refuse { "CC(C)=O" }, -- ketone comes from a ketal (see protection)
    refuse { "O=Cc1ccccc1" }, -- kept to aldehydes that are sold as their acetals
}

disconnection "semicarbazone-formation" {
    about = "Semicarbazone formation; terminal NH2 of semicarbazide condenses",
    target = "[#6:1][C;X3;!$(C[#7,#8,#16]):2]=[N;X2:3]-!@[N;X3;H1:4][C;X3:5](=[O;X1:6])[N;X3;H2:7]",
    from = "[#6:1][C;X3:2]=[O;X1].[N;X3;H2:3][N;X3;H1:4][C;X3:5](=[O;X1:6])[N;X3;H2:7]",
    conditions = "amine-rt",
    also_attacks = { "aldehyde", "ketone", "acyl halide" },
    recipe = "semicarbazide·HCl, NaOAc, EtOH-H2O, rt",
    yield = { 85, 97 },
    source = "Clayden, Greeves, Warren, Organic Chemistry; from memory",
    example { "NC(=O)N/N=C/c1ccc(o1)[N+](=O)[O-]", from = { "O=Cc1ccc(o1)[N+](=O)[O-]", "NNC(N)=O" } },
    example { "CC(C)=NNC(N)=O", from = { "CC(C)=O", "NNC(N)=O" } },
    refuse { "CC(C)=NNc1ccccc1" }, -- arylhydrazone (own rule)
}

disconnection "enamine-formation" {
    about = "Enamine formation; less substituted enamine of an unsymmetrical ketone",
    target = "[#6:4][C;X3:1](=[C;X3;H1;!$(C-C=O);!$(C-C#N);!$(C-[N+]):2])-!@[N;X3;H0:3]([C;X4:5])[C;X4:6]",
    from = "[#6:4][C;X3:1](=[O;X1])[C;X4;H2:2].[N;X3;H1:3]([C;X4:5])[C;X4:6]",
    conditions = "acid-hot-dry",
    also_attacks = { "aldehyde", "ketone", "acyl halide", "enone", "anhydride" },
    recipe = "secondary amine, TsOH (cat), toluene, Dean-Stark; also: TiCl4; 4 Å sieves",
    yield = { 70, 92 },
    source = "Clayden, Greeves, Warren, Organic Chemistry; from memory",
    example { "C1CCC(=CC1)N1CCOCC1", from = { "O=C1CCCCC1", "C1COCCN1" } },
    example { "C1CCC(=C1)N1CCCC1", from = { "O=C1CCCC1", "C1CCCN1" } },
    refuse { "CC(=O)N(C)C=C" }, -- enamide nitrogen is acylated
}

disconnection "silyl-enol-ether" {
    about = "Silyl enol ether formation; kinetic: less substituted side with LDA at -78 °C",
    target = "[#6:4][C;X3:1](=[C;X3;H1:2])[O;X2:3][Si;X4:5]([C;H3:6])([C;H3:7])[C;H3:8]",
    from = "[#6:4][C;X3:1](=[O;X1;H0:3])[C;X4;H2:2].[Cl;X1][Si;X4:5]([C;H3:6])([C;H3:7])[C;H3:8]",
    conditions = "base-hindered",
    also_attacks = { "aldehyde", "ketone", "ester", "alkyl halide", "free alcohol", "free acid", "acyl halide",
        "nitro", "terminal alkyne" },
    recipe = "LDA, THF, -78 °C, then TMSCl; also: TMSOTf, Et3N",
    yield = { 80, 95 },
    cautions = { "lithium diisopropylamide", "chlorotrimethylsilane" },
    source = "Carey and Sundberg, Advanced Organic Chemistry, Part B; from memory",
    example { "CC1CCCC=C1O[Si](C)(C)C", from = { "CC1CCCCC1=O", "C[Si](C)(C)Cl" } },
    example { "C[Si](C)(C)OC1=CCCCC1", from = { "O=C1CCCCC1", "C[Si](C)(C)Cl" } },
    refuse { "CC1=C(O[Si](C)(C)C)CCCC1" }, -- the more substituted (thermodynamic) isomer needs Et3N, DMF, heat
}

interconversion "saegusa-oxidation" {
    about = "Saegusa oxidation; C=C on the side of the silyl enol ether; E in chains",
    rxno = "RXNO:0000544",
    target = "[#6:4][C;X3:1](=[O;X1:2])[C;X3;H1:3]=[C;X3;H1:5][C;X4:6]",
    from = "[#6:4][C;X3:1]([O;X2;H0:2][Si]([C;H3])([C;H3])[C;H3])=[C;X3;H1:3][C;X4;H2:5][#6:6]",
    also_attacks = { "alkene", "terminal alkyne", "thiol", "aryl halide" },
    recipe = "Pd(OAc)2 (0.1-1 equiv), O2 or benzoquinone, MeCN or DMSO, rt",
    yield = { 70, 92 },
    source = "Y. Ito, T. Hirao and T. Saegusa, J. Org. Chem. 1978, 43, 1011; from memory",
    example { "O=C1C=CCC(C)(C)C1", from = { "C[Si](C)(C)OC1=CCCC(C)(C)C1" } },
    example { "O=C1C=CCCC1", from = { "C[Si](C)(C)OC1=CCCCC1" } },
    refuse { "CC(=O)C1=CCCCC1" }, -- alpha carbon of the new C=C must come from the CH of the silyl enol ether
}

interconversion "selenoxide-elimination" {
    about = "Alpha-selenation and selenoxide elimination; syn elimination; E in chains",
    target = "[#6:4][C;X3;R:1](=[O;X1:2])[C;X3;H1;R:3]=[C;X3;H1;R:5][#6:6]",
    from = "[#6:4][C;X3:1](=[O;X1:2])[C;X4;H2:3][C;X4;H2:5][#6:6]",
    conditions = "base-hindered",
    also_attacks = { "aldehyde", "ketone", "ester", "alkyl halide", "free alcohol", "thioether",
        "tertiary amine" },
    recipe = "LDA, PhSeCl or PhSeBr, -78 °C, then H2O2, pyridine, 0 °C to rt",
    yield = { 65, 88 },
    cautions = { "lithium diisopropylamide", "organoselenium compounds", "hydrogen peroxide", "pyridine" },
    source = "H. J. Reich, J. M. Renga and I. L. Reich, J. Am. Chem. Soc. 1975, 97, 5434; from memory",
    example { "CC1(C)CC=CC(=O)C1", from = { "CC1(C)CCCC(=O)C1" } },
    example { "O=C1C=CCCC1", from = { "O=C1CCCCC1" } },
    refuse { "CC1=CC(=O)CCC1" }, -- beta carbon disubstituted; the ketone precursor has CH there (use the trisubstituted rule)
}

interconversion "conjugate-reduction" {
    about = "Conjugate reduction of an enone; 1,4-reduction; ketone survives",
    target = "[#6:6][C;X3:2](=[O;X1:1])[C;X4;H2:3][C;X4;H2:4][c:5]",
    from = "[#6:6][C;X3:2](=[O;X1:1])/[C;X3;H1:3]=[C;X3;H1:4]/[#6:5]",
    conditions = "h2-pd",
    also_attacks = { "alkene", "alkyne", "nitro", "azide", "benzyl ether", "Cbz amine", "aryl halide" },
    recipe = "H2, Pd/C, EtOAc, 1 atm; also: [(PPh3)CuH]6; L-Selectride, -78 °C",
    yield = { 80, 97 },
    cautions = { "hydrogen" },
    source = "Carey and Sundberg, Advanced Organic Chemistry, Part B; from memory",
    example { "CC(=O)CCc1ccc(O)cc1", from = { "CC(=O)/C=C/c1ccc(O)cc1" } },
    example { "O=C(CCc1ccccc1)c1ccccc1", from = { "O=C(/C=C/c1ccccc1)c1ccccc1" } },
    refuse { "CC(=O)C(C)(C)c1ccccc1" }, -- alpha carbon carries no H
}

interconversion "pinacol-rearrangement" {
    about = "Pinacol rearrangement; the better cation forms first, the better migrating group moves; " ..
        "symmetrical diols only give one ketone",
    rxno = "RXNO:0000050",
    target = "[C;X4;H0:1]([C;X4:3])([C;X4:4])([C;X4:5])[C;X3:2](=[O;X1:6])[C;X4:7]",
    from = "[C;X4;H0:1]([C;X4:3])([C;X4:4])([O;X2;H1])[C;X4;H0:2]([C;X4:5])([O;X2;H1:6])[C;X4:7]",
    when = function(m) return comes_from_symmetrical_diol(m) end,
    conditions = "acid-aq-strong",
    also_attacks = { "alkene", "acetal", "silyl ether", "epoxide", "tert-butyl ester", "free alcohol" },
    recipe = "H2SO4 (conc), 0 °C; also: TsOH, benzene, reflux",
    yield = { 60, 85 },
    cautions = { "sulfuric acid" },
    source = "Kürti and Czakó, Strategic Applications of Named Reactions in Organic Synthesis; from memory",
    example { "O=C1CCCCC12CCCC2", from = { "OC1(CCCC1)C1(O)CCCC1" } },
    example { "CC(=O)C(C)(C)C", from = { "CC(C)(O)C(C)(C)O" } },
    refuse { "CC(=O)CC" }, -- no quaternary carbon beside the carbonyl
    refuse { "CCC(=O)C(C)(C)C" }, -- an unsymmetrical diol gives mixtures
}

interconversion "semipinacol-rearrangement" {
    about = "Semipinacol rearrangement; inversion at the carbon that loses the leaving group; ring expands " ..
        "by one",
    target = "[C;X4;H1:1]([C;X4;H3,H2:4])([C;X4;H2;R:5])[C;X3;H0;R:2](=[O;X1:3])[C;X4;H2:6]",
    from = "[C;X4;H1:1]([C;X4:4])([O;X2][S;X4](=O)(=O)[C;H3])[C;X4;H0:2]([C;X4:5])([C;X4:6])[O;X2;H1:3]",
    conditions = "lewis-acid",
    also_attacks = { "epoxide", "acetal", "aldehyde" },
    recipe = "Et3Al or Et2AlCl, CH2Cl2, -78 to 0 °C; also: CaCO3, LiClO4, heat; OTs",
    yield = { 60, 90 },
    cautions = { "triethylaluminium" },
    source = "Kürti and Czakó, Strategic Applications of Named Reactions in Organic Synthesis; from memory",
    example { "CC1CCCCCC1=O", from = { "CC(OS(C)(=O)=O)C1(O)CCCCC1" } },
    refuse { "CC1(C)CCCCC1=O" }, -- quaternary alpha carbon: the leaving group would be tertiary
}

interconversion "tiffeneau-demjanov" {
    about = "Tiffeneau-Demjanov rearrangement; ring expansion by one; less substituted carbon migrates in " ..
        "unsymmetrical cases",
    rxno = "RXNO:0000381",
    target = "[C;X4;H2;R:5]-[C;X4;H2;R:1]-[C;X3;R:2](=[O;X1:3])-[C;X4;H2;R:4]",
    from = "[C;X4;H2;R:5]-[C;X4;H0;R:2]([O;X2;H1:3])([C;X4;H2:1][N;X3;H2])-[C;X4;H2;R:4]",
    conditions = "diazotisation",
    also_attacks = { "primary amine", "secondary amine", "phenol", "aniline", "thiol" },
    recipe = "NaNO2, AcOH-H2O, 0 °C to rt",
    yield = { 55, 75 },
    cautions = { "sodium nitrite" },
    source = "Kürti and Czakó, Strategic Applications of Named Reactions in Organic Synthesis; from memory",
    example { "O=C1CCCCCC1", from = { "NCC1(O)CCCCC1" } },
    example { "O=C1CCCCC1", from = { "NCC1(O)CCCC1" } },
    refuse { "CC1CCCCCC1=O" }, -- unsymmetrical ketone: the less substituted carbon migrates, so the methyl group would not be alpha
}

interconversion "meyer-schuster" {
    about = "Meyer-Schuster rearrangement; oxygen moves 1,3; E favoured where it matters",
    rxno = "RXNO:0000476",
    target = "[#6:1][C;X3;H0:2](=[O;X1])-!@[C;X3;H1:3]=;!@[C;X3;H0:4]([C;X4:5])[C;X4:6]",
    from = "[#6:1][C;X2:2]#[C;X2;H0:3][C;X4;H0:4]([O;X2;H1])([C;X4:5])[C;X4:6]",
    also_attacks = { "alkyne", "alkene", "acetal", "epoxide", "thiol" },
    recipe = "Au(I) catalyst, MeOH-CH2Cl2, rt; also: VO(acac)2; H2SO4",
    yield = { 65, 90 },
    source = "Kürti and Czakó, Strategic Applications of Named Reactions in Organic Synthesis; from memory",
    example { "CCCCC(=O)C=C1CCCCC1", from = { "CCCCC#CC1(O)CCCCC1" } },
    example { "CCCC(=O)C=C1CCCC1", from = { "CCCC#CC1(O)CCCC1" } },
    refuse { "CC(=O)C1=CCCCC1" }, -- Rupe product: C=C is not exocyclic to the carbinol ring
}

interconversion "quinone-from-hydroquinone" {
    about = "Oxidation of a hydroquinone to a quinone; para (or ortho) dihydroxyarene",
    target = "[O;X1:1]=[C;X3;R:2]1[C;X3:3]=[C;X3:4][C;X3;R:5](=[O;X1:6])[C;X3:7]=[C;X3:8]1",
    from = "[O;X2;H1:1]-[c:2]1[c:3][c:4][c:5](-[O;X2;H1:6])[c:7][c:8]1",
    also_attacks = { "thiol", "thioether", "aniline", "phenol", "primary amine" },
    recipe = "(NH4)2Ce(NO3)6, MeCN-H2O, 0 °C; also: Ag2O; PhI(OAc)2; dimethyl ether of the hydroquinone",
    yield = { 75, 95 },
    cautions = { "ammonium cerium(IV) nitrate" },
    source = "Carey and Sundberg, Advanced Organic Chemistry, Part B; from memory",
    example { "COC1=CC(=O)C=C(CCC(=O)OC)C1=O", from = { "COc1cc(O)cc(CCC(=O)OC)c1O" } },
    example { "O=C1C=CC(=O)C=C1", from = { "Oc1ccc(O)cc1" } },
    refuse { "O=C1C=CC(=O)CC1" }, -- not fully conjugated (enedione)
}

interconversion "riley-oxidation" {
    about = "Selenium dioxide oxidation of a ketone to a 1,2-diketone; CH2 beside the carbonyl",
    target = "[c:1][C;X3;H0:2](=[O;X1:3])[C;X3;H0:4](=[O;X1])[#6:5]",
    from = "[c:1][C;X3;H0:2](=[O;X1:3])[C;X4;H2:4][#6:5]",
    also_attacks = { "alkene", "aldehyde", "thiol", "thioether" },
    recipe = "SeO2, dioxane-H2O or DMSO, reflux",
    yield = { 60, 85 },
    cautions = { "selenium dioxide" },
    source = "March's Advanced Organic Chemistry; from memory",
    example { "O=C(C(=O)c1ccc(F)cc1)c1ccccc1", from = { "O=C(Cc1ccc(F)cc1)c1ccccc1" } },
    example { "O=C(C(=O)c1ccccc1)c1ccccc1", from = { "O=C(Cc1ccccc1)c1ccccc1" } },
    refuse { "O=C(c1ccccc1)CC(C)=O" }, -- 1,3-diketone
}

interconversion "benzoin-oxidation" {
    about = "Oxidation of a benzoin to the 1,2-diketone; milder alcohol oxidants may cleave the C-C bond instead",
    target = "[c:1][C;X3;H0:2](=[O;X1:3])[C;X3;H0:4](=[O;X1:5])[c:6]",
    from = "[c:1][C:2](=[O:3])[CH1:4]([OH1:5])[c:6]",
    also_attacks = { "aldehyde", "primary alcohol", "thiol", "thioether", "primary amine" },
    recipe = "NH4NO3, cat. Cu(OAc)2, AcOH-H2O, reflux; also: HNO3, AcOH; CuSO4, pyridine-H2O",
    yield = { 85, 96 },
    cautions = { "nitric acid", "ammonium nitrate" },
    source = "Clarke and Dreger, Org. Synth. Coll. Vol. 1, 87; from memory",
    example { "O=C(C(=O)c1ccccc1)c1ccccc1", from = { "O=C(c1ccccc1)C(O)c1ccccc1" } },
    example { "COc1ccc(cc1)C(=O)C(=O)c1ccc(OC)cc1", from = { "COc1ccc(cc1)C(=O)C(O)c1ccc(OC)cc1" } },
    refuse { "CC(=O)C(=O)c1ccccc1" }, -- one aryl group only
}

interconversion "benzylic-oxidation-ketone" {
    about = "Benzylic oxidation to a ketone; benzylic CH2; the position para to a donor first",
    target = "[c:1][C;X3;H0;R;$(C1(=O)c:c[CX4][CX4]1),$(C1(=O)c:c[CX4,O][CX4][CX4]1):2](=[O;X1])[C;X4;R:3]",
    from = "[c:1][C;X4;H2:2][C;X4:3]",
    conditions = "chromic",
    also_attacks = { "free alcohol", "thiol", "thioether", "primary amine", "secondary amine", "alkene",
        "aldehyde" },
    recipe = "CrO3, AcOH, 0-20 °C; also: KMnO4; DDQ, H2O; tBuOOH, Cr or Rh catalyst",
    yield = { 50, 80 },
    cautions = { "chromium trioxide" },
    source = "March's Advanced Organic Chemistry; from memory",
    example { "COc1ccc2C(=O)CCCc2c1", from = { "COc1ccc2CCCCc2c1" } },
    example { "O=C1CCCc2ccccc21", from = { "C1CCc2ccccc2C1" } },
    refuse { "O=C(c1ccccc1)N" }, -- amide carbonyl
    refuse { "CCC(=O)c1ccccc1" }, -- open chains: by acylation
}

interconversion "sommelet" {
    about = "Sommelet reaction; benzylic CH2X becomes CHO",
    rxno = "RXNO:0000118",
    target = "[c:1][C;X3;H1:2]=[O;X1]",
    from = "[c:1][C;X4;H2:2][Br;X1]",
    conditions = "alkylation",
    also_attacks = { "alkyl halide", "acyl halide", "epoxide", "primary amine" },
    recipe = "hexamethylenetetramine, AcOH-H2O, reflux; also: Kornblum (DMSO, NaHCO3, 100 °C)",
    yield = { 55, 80 },
    source = "Kürti and Czakó, Strategic Applications of Named Reactions in Organic Synthesis; from memory",
    example { "O=Cc1ccc(cc1)C(C)(C)C", from = { "BrCc1ccc(cc1)C(C)(C)C" } },
    example { "O=Cc1ccccc1", from = { "BrCc1ccccc1" } },
    refuse { "O=CCc1ccccc1" }, -- not a benzylic halide
}

interconversion "cyclic-diol-to-dialdehyde" {
    about = "Cleavage of a cyclic vicinal diol to a dialdehyde (Malaprade reaction); cis-diols react much faster",
    rxno = "RXNO:0000650",
    target = "[C;X3;H1:1](=[O:2])[C;X4:3][C;X4:4][C;X4:5][C;X3;H1:6]=[O:7]",
    from = "[C;H1:1]1([O;H1:2])[C:3][C:4][C:5][C;H1:6]1[O;H1:7]",
    conditions = "periodate",
    also_attacks = { "thioether", "hydroquinone", "α-hydroxy ketone", "β-amino alcohol" },
    recipe = "NaIO4, THF/H2O or CH2Cl2/silica, rt",
    yield = { 75, 95 },
    cautions = { "sodium periodate" },
    source = "March's Advanced Organic Chemistry; from memory",
    example { "COC(=O)C(CC=O)CC=O", from = { "COC(=O)C1CC(O)C(O)C1" } },
    example { "O=CCCCC=O", from = { "OC1CCCC1O" } },
    refuse { "O=CCCC=O" }, -- succinaldehyde: would need a cyclobutanediol
}

interconversion "swern-aldehyde" {
    about = "Swern oxidation; stops at the aldehyde; alpha centre mostly kept",
    rxno = "RXNO:0000154",
    also = { "corey-suggs-oxidation" },
    target = "[C;X4:1][C;X3;H1:2]=[O;X1:3]",
    from = "[C;X4:1][C;X4;H2:2][O;X2;H1:3]",
    conditions = "swern-dmp",
    also_attacks = { "free alcohol", "thiol", "thioether", "primary amine", "secondary amine" },
    recipe = "(COCl)2, DMSO, CH2Cl2, -78 °C, then Et3N; also: Dess-Martin periodinane, TEMPO-NaOCl",
    yield = { 80, 97 },
    cautions = { "oxalyl chloride", "dimethyl sulfide" },
    source = "A. J. Mancuso and D. Swern, Synthesis 1981, 165; from memory",
    example { "CC(C)(C)OC(=O)NCCCC=O", from = { "CC(C)(C)OC(=O)NCCCCO" } },
    example { "CCCCCCCC=O", from = { "CCCCCCCCO" } },
    refuse { "CC(C)C(=O)C" }, -- ketone comes from a secondary alcohol
}

disconnection "oxime-formation" {
    about = "Oxime formation; E/Z mixture; E favoured for aldoximes",
    target = "[#6:1][C;X3;!$(C[#7,#8,#16]):2]=[N;X2:3][O;X2;H1:4]",
    from = "[#6:1][C;X3:2]=[O;X1].[N;X3;H2:3][O;X2;H1:4]",
    conditions = "amine-rt",
    also_attacks = { "aldehyde", "ketone", "acyl halide", "enone", "anhydride" },
    recipe = "NH2OH·HCl, NaOAc, EtOH-H2O, rt to reflux",
    yield = { 85, 98 },
    cautions = { "hydroxylamine hydrochloride" },
    source = "Clayden, Greeves, Warren, Organic Chemistry; from memory",
    example { "ON=C1CCN(CC1)C(=O)OC(C)(C)C", from = { "O=C1CCN(CC1)C(=O)OC(C)(C)C", "NO" } },
    example { "ON=C1CCCCC1", from = { "O=C1CCCCC1", "NO" } },
    refuse { "CO/N=C(/C)C" }, -- O-alkyl oxime needs an alkoxyamine
}

disconnection "hydrazone-formation" {
    about = "Hydrazone formation; terminal NH2 condenses; E favoured",
    target = "[#6:1][C;X3;!$(C[#7,#8,#16]):2]=[N;X2:3]-!@[N;X3;H1;!$(NC=[O,S]):4][#6:5]",
    from = "[#6:1][C;X3:2]=[O;X1].[N;X3;H2:3][N;X3;H1:4][#6:5]",
    conditions = "amine-rt",
    also_attacks = { "aldehyde", "ketone", "acyl halide", "enone", "anhydride" },
    recipe = "hydrazine, AcOH or H2SO4 (cat), EtOH, rt to reflux",
    yield = { 80, 97 },
    cautions = { "hydrazine", "sulfuric acid" },
    source = "Clayden, Greeves, Warren, Organic Chemistry; from memory",
    example { "C/C(=N\\Nc1ccc(cc1[N+](=O)[O-])[N+](=O)[O-])c1ccccc1", from = { "CC(=O)c1ccccc1", "NNc1ccc(cc1[N+](=O)[O-])[N+](=O)[O-]" } },
    example { "C1CCC(CC1)=NNc1ccccc1", from = { "O=C1CCCCC1", "NNc1ccccc1" } },
    refuse { "CC(C)=NNC(N)=O" }, -- semicarbazone (own rule)
}

disconnection "imine-formation" {
    about = "Imine formation (carbonyl compound to imine conversion); E; remove water",
    rxno = "RXNO:0000367",
    target = "[#6:1][C;X3;!$(C[#7,#8,#16]):2]=[N;X2:3]-!@[#6;!$(C=[O,N,S]):4]",
    from = "[#6:1][C;X3:2]=[O;X1].[N;X3;H2:3][#6:4]",
    conditions = "amine-rt",
    also_attacks = { "aldehyde", "ketone", "acyl halide", "enone", "anhydride" },
    recipe = "EtOH or toluene, MgSO4 or 4 Å sieves, AcOH (cat), rt to reflux",
    yield = { 80, 97 },
    source = "Clayden, Greeves, Warren, Organic Chemistry; from memory",
    example { "COc1ccc(cc1)/N=C/c1ccccc1Cl", from = { "O=Cc1ccccc1Cl", "COc1ccc(N)cc1" } },
    example { "C(=Nc1ccccc1)c1ccccc1", from = { "O=Cc1ccccc1", "Nc1ccccc1" } },
    refuse { "CN(C)C=NC" }, -- amidine carbon bears a second nitrogen
}

interconversion "alkyne-hydration" {
    about = "Mercury-catalysed hydration of a terminal alkyne; Markovnikov: methyl ketone",
    target = "[#6:1][C;X3;H0:2](=[O;X1])[C;X4;H3:3]",
    from = "[#6:1][C;X2;H0:2]#[C;X2;H1:3]",
    conditions = "acid-aq-mild",
    also_attacks = { "alkyne", "alkene", "acetal", "silyl ether", "epoxide", "thiol" },
    recipe = "HgSO4 (cat), H2SO4, MeOH-H2O, 60 °C; also: Au(I) catalyst, MeOH-H2O",
    yield = { 65, 90 },
    cautions = { "mercury(II) sulfate", "sulfuric acid" },
    source = "Org. Synth. Coll. Vol. 4 (1-acetylcyclohexanol); from memory",
    example { "CC(=O)C1(O)CCCCC1", from = { "C#CC1(O)CCCCC1" } },
    example { "CCCCC(C)=O", from = { "CCCCC#C" } },
    refuse { "CC(=O)OC" }, -- ester carbonyl
}

interconversion "ozonolysis-terminal-alkene" {
    about = "Ozonolysis of a terminal alkene (alkene oxidative cleavage); both alkene carbons become C=O; reductive work-up",
    rxno = "RXNO:0000344",
    target = "[#6:1][C;X3;H1:2]=[O;X1]",
    from = "[#6:1][C;X3;H1:2]=[C;X3;H2]",
    conditions = "ozone",
    also_attacks = { "alkene", "alkyne", "thioether", "thiol", "primary amine", "secondary amine",
        "tertiary amine", "enol ether" },
    recipe = "O3, CH2Cl2-MeOH, -78 °C, then Me2S or PPh3; also: OsO4 (cat), NaIO4",
    yield = { 70, 90 },
    cautions = { "ozone", "ozonides", "triphenylphosphine" },
    source = "Clayden, Greeves, Warren, Organic Chemistry; from memory",
    example { "COC(=O)CCCCCCCC=O", from = { "COC(=O)CCCCCCCC=C" } },
    example { "CCCCCC=O", from = { "CCCCCC=C" } },
    refuse { "COC(=O)CCCC(C)=O" }, -- ketone needs a 1,1-disubstituted alkene
}

interconversion "aldehyde-from-ester" {
    about = "Ester to aldehyde reduction with DIBAL; stops at the tetrahedral intermediate below -70 °C; over-reduction is the rival",
    target = "[C;X4:1][C;X3;H1:2]=[O;X1:3]",
    from = "[C;X4:1][C;X3;H0:2](=[O;X1:3])[O;X2][C;H3]",
    conditions = "dibal",
    also_attacks = { "aldehyde", "ketone", "ester", "free acid", "amide", "nitrile", "acyl halide",
        "epoxide" },
    recipe = "DIBAL-H (1.1 equiv), toluene or CH2Cl2, -78 °C, quench cold; also: ethyl ester",
    yield = { 65, 88 },
    cautions = { "diisobutylaluminium hydride" },
    source = "P. Garner and J. M. Park, J. Org. Chem. 1987, 52, 2361; from memory",
    example { "CC(C)(C)OC(=O)N1[C@H](C=O)COC1(C)C", from = { "CC(C)(C)OC(=O)N1[C@H](C(=O)OC)COC1(C)C" } },
    example { "CCCCC=O", from = { "COC(=O)CCCC" } },
    refuse { "CC(C)=O" }, -- ketone carbon bears no H
}

interconversion "aldehyde-from-nitrile" {
    about = "Nitrile to aldehyde reduction with DIBAL; imine is hydrolysed on work-up",
    target = "[#6:1][C;X3;H1:2]=[O;X1]",
    from = "[#6:1][C;X2;H0:2]#[N;X1]",
    conditions = "dibal",
    also_attacks = { "aldehyde", "ketone", "ester", "free acid", "amide", "acyl halide", "epoxide" },
    recipe = "DIBAL-H, toluene or CH2Cl2, -78 to 0 °C, then aqueous acid; also: Raney Ni, HCO2H (Stephen: SnCl2, HCl)",
    yield = { 65, 90 },
    cautions = { "diisobutylaluminium hydride" },
    source = "Larock, Comprehensive Organic Transformations; from memory",
    example { "O=Cc1ccc(Br)cc1F", from = { "N#Cc1ccc(Br)cc1F" } },
    example { "O=Cc1ccccc1", from = { "N#Cc1ccccc1" } },
    refuse { "CC(C)=O" }, -- ketone needs an organometallic and the nitrile
}
