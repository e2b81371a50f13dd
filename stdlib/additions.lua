-- Additions to alkenes and alkynes, with the rules of Markovnikov, of syn and of anti addition.
-- Yields are typical ranges and sources stand from memory unless a source says otherwise.

pack {
    name = "additions",
    version = "0.1.0",
    licence = "CC0-1.0",
    about = "Additions to alkenes and alkynes, regio- and stereoselective",
    needs = { "synthons", "preferences" },
}

local MARCH = "March's Advanced Organic Chemistry; from memory"
local CLAYDEN = "Clayden, Greeves, Warren, Organic Chemistry; from memory"

-- A secondary carbon beside a tertiary or quaternary one: its cation rearranges.
local REARRANGES = "$([CX4;H1]([CX4])([!#6])[CX4;H0]([#6])([#6])[#6]),$([CX4;H1]([CX4])([!#6])[CX4;H1]([#6])[#6])"

local HALIDES = {
    { "hydrobromination", "Br", "HBr, CH2Cl2 or AcOH, -20 to 25 °C, no peroxide", "hydrobromic acid" },
    { "hydrochlorination", "Cl", "HCl (gas), CH2Cl2 or Et2O, 0 °C; also: SOCl2, SiO2", "hydrochloric acid" },
    { "hydroiodination", "I", "KI, H3PO4 or HI, 20-80 °C; also: TMSCl, NaI, H2O", "phosphoric acid" },
}

for _, one in ipairs(HALIDES) do
    local name, x, recipe, caution = one[1], one[2], one[3], one[4]
    interconversion(name .. "-of-alkene") {
        about = "Ionic addition of a hydrogen halide to an alkene; Markovnikov; cold to a diene: 1,2",
        target = "[CX4;H0,H1;!$(C([F,Cl,Br,I])[F,Cl,Br,I]):1]([" .. x ..
            ":3])[CX4;!H0;!$(C[!#6;!#1]):2]",
        from = "[C:1]=[C:2]",
        when = function(m)
            if m.atom[1].hydrogens == 0 then return true end
            for _, hit in ipairs(m.molecule:find("[CX4;H1;" .. REARRANGES .. ";!$(C-[c,$(C=C)])]")) do
                if hit[1] == m.atom[1].index and m.atom[2].carbons < 3 then return false end
            end
            return m.atom[1].carbons >= m.atom[2].carbons
        end,
        prefer = { "markovnikov", carbon = 1 },
        conditions = "acid-dry-strong",
        also_attacks = { "alkene", "epoxide", "acetal", "silyl ether", "tert-butyl ester", "Boc amine", "free alcohol" },
        recipe = recipe,
        yield = { 70, 90 },
        cautions = { caution },
        source = CLAYDEN,
        example { "CC(C)(" .. x .. ")CC", from = { "CC(C)=CC" } },
        example { "C=CC(C)" .. x, from = { "C=CC=C" } },
        refuse { "CC(C)CC" .. x }, -- the less stable cation
    }
end

interconversion "hydrobromination-of-diene-1-4" {
    about = "Addition of hydrogen bromide to a diene in the warmth: the more substituted alkene, 1,4",
    target = "[CX4;H1,H2:1]([Br:5])[CX3:2]=[CX3:3][CX4;!H0:4]",
    from = "[C:1]=[C:2][C:3]=[C:4]",
    prefer = { "zaitsev", first = 2, second = 3 },
    conditions = "acid-dry-strong",
    also_attacks = { "alkene", "epoxide", "acetal", "silyl ether" },
    recipe = "HBr, 40 °C, until equilibrated",
    yield = { 60, 80 },
    cautions = { "hydrobromic acid" },
    source = CLAYDEN,
    example { "CC=CCBr", from = { "C=CC=C" } },
    refuse { "CC(Br)C=C" }, -- the kinetic product
}

-- ---- Water ------------------------------------------------------------------------------------

interconversion "acid-hydration-with-shift" {
    about = "Acid hydration of an alkene beside a branched carbon: the secondary cation rearranges to the tertiary one",
    target = "[CX4;H0;$(C([OX2H])([#6])([#6])[#6]):1]([OX2H:3])[CX4;H1;$(C([CX4;H0])([#6])[#6]):2]([#6:4])[CX4;H2,H3:5]",
    from = "[C:1]([#6:4])[C:2]=[C:5].[O:3]",
    prefer = { "migratory aptitude", group = 4, to = 2 },
    conditions = "acid-aq-strong",
    also_attacks = { "alkene", "epoxide", "acetal", "silyl ether", "free alcohol", "Boc amine", "tert-butyl ester" },
    recipe = "H2SO4 (aq, dilute), 0-25 °C",
    yield = { 50, 80 },
    cautions = { "sulfuric acid" },
    source = MARCH,
    example { "CC(C)C(C)(C)O", from = { "CC(C)(C)C=C", "O" } },
    refuse { "CC(O)C(C)(C)C" }, -- the cation does not wait for water
}

interconversion "acid-hydration-with-hydride-shift" {
    about = "Acid hydration of an alkene beside a tertiary carbon: hydride moves, the tertiary alcohol forms",
    target = "[CX4;H0;$(C([OX2H])([#6])([#6])[#6]):1]([OX2H:3])[CX4;H2:2][CX4;H2,H3:5]",
    from = "[C;H1:1][C;H1:2]=[C;H1,H2:5].[O:3]",
    conditions = "acid-aq-strong",
    also_attacks = { "alkene", "epoxide", "acetal", "silyl ether", "free alcohol", "Boc amine", "tert-butyl ester" },
    recipe = "H2SO4 (aq, dilute), 0-25 °C",
    yield = { 40, 70 },
    cautions = { "sulfuric acid" },
    source = MARCH,
    example { "CCC(C)(C)O", from = { "CC(C)C=C", "O" } },
    refuse { "CC(O)C(C)C" }, -- secondary, beside a tertiary carbon
}

interconversion "alkyne-hydroboration-oxidation" {
    about = "Hydroboration of a terminal alkyne with a hindered borane, oxidation: the aldehyde",
    target = "[#6:3][CX4;H2:2][CX3;H1:1]=[OX1:4]",
    from = "[#6:3][C:2]#[C;H1:1].[O:4]",
    conditions = "borane",
    also_attacks = { "alkene", "alkyne", "aldehyde", "ketone", "free acid" },
    recipe = "disiamylborane or 9-BBN, THF, 0 °C, then H2O2, NaOH",
    yield = { 65, 85 },
    cautions = { "borane-tetrahydrofuran complex", "hydrogen peroxide", "sodium hydroxide" },
    source = "Carey and Sundberg, Advanced Organic Chemistry, Part B; from memory",
    example { "CCCCCC=O", from = { "CCCCC#C", "O" } },
    refuse { "CCCCC(C)=O" }, -- the methyl ketone comes by mercury-catalysed hydration
}

interconversion "internal-alkyne-hydration" {
    about = "Mercury- or gold-catalysed hydration of an internal alkyne; one ketone only from a symmetrical or aryl alkyne",
    target = "[#6:3][CX3:1](=[OX1:4])[CX4;H2:2][#6:5]",
    from = "[#6:3][CX2:1]#[CX2:2][#6:5].[O:4]",
    when = function(m)
        return m.atom[3].aromatic ~= m.atom[5].aromatic or m.atom[1].carbons == 2 and m.atom[3].carbons == m.atom[5].carbons
    end,
    prefer = { "markovnikov", carbon = 1 },
    conditions = "acid-aq-mild",
    also_attacks = { "alkyne", "alkene", "acetal", "silyl ether", "epoxide", "thiol" },
    recipe = "HgSO4 (cat), H2SO4, MeOH-H2O, 60 °C; also: Au(I) catalyst, MeOH-H2O",
    yield = { 60, 85 },
    cautions = { "mercury(II) sulfate", "sulfuric acid" },
    source = MARCH,
    example { "CCC(=O)c1ccccc1", from = { "CC#Cc1ccccc1", "O" } },
    refuse { "CC(=O)Cc1ccccc1" }, -- the cation beside the ring is the more stable one
}

-- ---- Anti additions ------------------------------------------------------------------------------

for _, one in ipairs { { "bromination", "Br", "Br2, CH2Cl2, 0 °C; also: pyridinium tribromide", "bromine" },
    { "chlorination", "Cl", "Cl2, CH2Cl2, -20 °C; also: SO2Cl2, Et4NCl3", "chlorine" } } do
    local name, x, recipe, caution = one[1], one[2], one[3], one[4]
    interconversion(name .. "-of-alkene") {
        about = "Addition of a halogen to an alkene; anti, through the halonium ion; the more electron-rich alkene first",
        target = "[CX4;!$(C([F,Cl,Br,I])[F,Cl,Br,I]):1]([" .. x .. ":3])[CX4;!$(C([F,Cl,Br,I])[F,Cl,Br,I]):2][" .. x .. ":4]",
        from = "[C:1]=[C:2]",
        addition = { "anti", 1, 2 },
        prefer = { "electron-rich alkene", first = 1, second = 2 },
        conditions = "br2",
        also_attacks = { "alkene", "alkyne", "phenol", "aniline", "ketone", "aldehyde", "thiol", "thioether", "enol ether" },
        recipe = recipe,
        yield = { 75, 95 },
        cautions = { caution },
        source = CLAYDEN,
        example { x .. "[C@@H]1CCCC[C@H]1" .. x, from = { "C1CCC=CC1" } },
        example { "C[C@@H](" .. x .. ")[C@@H](" .. x .. ")C", from = { "C/C=C/C" } },
        refuse { x .. "[C@H]1CCCC[C@H]1" .. x }, -- cis
    }
end

for _, one in ipairs { { "bromohydrin", "Br", "NBS, H2O-DMSO or H2O-THF, 0 °C; also: NBA", "N-bromosuccinimide" },
    { "chlorohydrin", "Cl", "NCS, H2O-acetone, rt; also: NaOCl, AcOH; Cl2, H2O", "N-chlorosuccinimide" },
    { "iodohydrin", "I", "NIS, H2O-MeCN, rt; also: I2, H2O", "iodine" } } do
    local name, x, recipe, caution = one[1], one[2], one[3], one[4]
    interconversion(name .. "-of-alkene") {
        about = "Halohydrin from an alkene; anti; water on the carbon that bears the positive charge better",
        target = "[CX4;H0,H1:1]([OX2H:3])[CX4;!$(C([F,Cl,Br,I])[F,Cl,Br,I]):2][" .. x .. ":4]",
        from = "[C:1]=[C:2].[O:3]",
        addition = { "anti", 1, 2 },
        prefer = { "markovnikov", carbon = 1 },
        conditions = "acid-aq-mild",
        also_attacks = { "alkene", "phenol", "aniline", "thiol", "thioether", "primary amine", "secondary amine" },
        recipe = recipe,
        yield = { 60, 85 },
        cautions = { caution },
        source = CLAYDEN,
        example { "C[C@]1(O)CCCC[C@@H]1" .. x, from = { "CC1=CCCCC1", "O" } },
        example { "OC(C" .. x .. ")c1ccccc1", from = { "C=Cc1ccccc1", "O" } },
        refuse { "CC1(" .. x .. ")CCCCC1O" }, -- water on the less substituted carbon
    }
end

-- ---- Syn additions --------------------------------------------------------------------------------

interconversion "dihydroxylation-of-alkene" {
    about = "Osmium-catalysed dihydroxylation; syn; the more electron-rich alkene first",
    target = "[CX4;!$(C([OX2])[!#6;!#1;!$([OX2H])]):1]([OX2H:3])[CX4:2][OX2H:4]",
    from = "[C:1]=[C:2]",
    addition = { "syn", 1, 2 },
    prefer = { "electron-rich alkene", first = 1, second = 2 },
    conditions = "oso4",
    also_attacks = { "primary amine", "secondary amine", "alkene", "thiol", "thioether" },
    recipe = "OsO4 (cat), NMO, acetone-H2O, rt; also: K2OsO4, K3Fe(CN)6; KMnO4, cold, dilute",
    yield = { 70, 95 },
    cautions = { "osmium tetroxide" },
    source = "V. VanRheenen, R. C. Kelly and D. Y. Cha, Tetrahedron Lett. 1976, 1973; from memory",
    example { "O[C@H]1CCCC[C@H]1O", from = { "C1CCC=CC1" } },
    refuse { "O[C@@H]1CCCC[C@H]1O" }, -- trans
}

interconversion "disubstituted-alkyne-to-cis-alkene" {
    about = "Hydrogenation of an alkyne over a poisoned catalyst; syn; before alkenes",
    target = "[#6;!$(C=O):3]/[CX3;H1;!R:1]=[CX3;H1;!R:2]\\[#6;!$(C=O):4]",
    from = "[#6:3][C:1]#[C:2][#6:4]",
    conditions = "h2-lindlar",
    also_attacks = { "alkyne", "azide", "nitro", "thiol", "thioether" },
    recipe = "H2 (1 atm), Lindlar catalyst (Pd/CaCO3-Pb), quinoline, EtOAc, rt",
    yield = { 80, 96 },
    cautions = { "hydrogen", "lead salts" },
    source = CLAYDEN,
    example { "CCC/C=C\\CCC", from = { "CCCC#CCCC" } },
    refuse { "CCC/C=C/CCC" }, -- anti addition: sodium in ammonia
}
