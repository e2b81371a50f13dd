-- Eliminations and rearrangements in which the question is which alkene, or which group moves.
-- Yields are typical ranges and sources stand from memory unless a source says otherwise.

pack {
    name = "eliminations",
    version = "0.1.0",
    licence = "CC0-1.0",
    about = "Eliminations and rearrangements, with the rules of Zaitsev, Hofmann and migratory aptitude",
    needs = { "synthons", "preferences" },
}

local MARCH = "March's Advanced Organic Chemistry; from memory"
local CLAYDEN = "Clayden, Greeves, Warren, Organic Chemistry; from memory"

-- The carbon that bore the leaving group is secondary or tertiary.
local function is_branched(m) return m.atom[1].carbons >= 2 + (m.atom[1].hydrogens == 0 and 1 or 0) end

-- Whether a group beside the alkene tells one side from the other: an arene, another double bond.
local function is_conjugated(m, atom)
    for _, near in ipairs(m.molecule:neighbours(atom.index)) do
        if near.order == 1 then
            if near.aromatic then return true end
            for _, far in ipairs(m.molecule:neighbours(near.index)) do
                if far.order > 1 then return true end
            end
        end
    end
    return false
end

-- An open chain with one group on each carbon gives both positions and both geometries, unless one is conjugated; the cis
-- alkene is never the main product.
local function is_one_alkene(m)
    local first, second = m.atom[1], m.atom[2]
    if not is_branched(m) then return false end
    if first.hydrogens ~= 1 or second.hydrogens ~= 1 then return true end
    for _, bond in ipairs(m.molecule:bonds()) do
        local here = bond[1] == first.index and bond[2] == second.index or bond[1] == second.index and bond[2] == first.index
        if here and bond.ring then return true end
        if here and bond.geometry == "cis" then return false end
    end
    return is_conjugated(m, first) or is_conjugated(m, second)
end

for _, x in ipairs { "Br", "Cl", "I" } do
    interconversion("dehydrohalogenation-zaitsev-" .. x:lower()) {
        about = "E2 elimination with a small base; the more substituted alkene; hydrogen and halogen anti-periplanar",
        target = "[CX3;H0,H1;!$(C[!#6;!#1]):1]=[CX3;!$(C[!#6;!#1]):2]",
        from = "[C:1]([" .. x .. "])[C;!H0:2]",
        when = is_one_alkene,
        addition = { "anti", 1, 2 },
        prefer = { "zaitsev", first = 1, second = 2 },
        conditions = "alkoxide",
        also_attacks = { "alkyl halide", "acyl halide", "ester", "aldehyde", "ketone", "epoxide" },
        recipe = "NaOEt, NaOMe or KOH, the alcohol, reflux; also: DBU",
        yield = { 60, 88 },
        cautions = { "potassium hydroxide" },
        source = CLAYDEN,
        example { "CC=C(C)C", from = { "CCC(C)(C)" .. x } },
        example { "CC(C)=C", from = { "CC(C)(C)" .. x } },
        refuse { "CCCC=C" }, -- the less substituted alkene, or from a primary halide
    }

    interconversion("dehydrohalogenation-hofmann-" .. x:lower()) {
        about = "E2 elimination with a bulky base; the less substituted alkene",
        target = "[CX3;H0,H1;!$(C[!#6;!#1]);!$(C-[CX3]=[OX1]):1]=[CX3;!$(C[!#6;!#1]):2]",
        from = "[C:1]([" .. x .. "])[C;!H0:2]",
        when = is_one_alkene,
        addition = { "anti", 1, 2 },
        prefer = { "hofmann", first = 1, second = 2 },
        conditions = "base-hindered",
        also_attacks = { "alkyl halide", "acyl halide", "ester", "aldehyde", "ketone", "terminal alkyne" },
        recipe = "KOtBu, tBuOH, reflux; also: KOCEt3",
        yield = { 55, 80 },
        cautions = { "potassium tert-butoxide" },
        source = MARCH,
        example { "CCC(C)=C", from = { "CCC(C)(C)" .. x } },
        refuse { "CC=C(C)C" }, -- the more substituted alkene
    }
end

interconversion "dehydration-acid" {
    about = "Acid dehydration of a secondary or tertiary alcohol; the more substituted, conjugated alkene",
    target = "[CX3;H0,H1;!$(C[!#6;!#1]);!$(C-[CX3]=[OX1]):1]=[CX3;!$(C[!#6;!#1]):2]",
    from = "[C:1]([OX2H])[C;!H0:2]",
    when = is_one_alkene,
    prefer = { "zaitsev", first = 1, second = 2 },
    conditions = "acid-aq-strong",
    also_attacks = { "free alcohol", "acetal", "silyl ether", "tert-butyl ester", "Boc amine", "epoxide" },
    recipe = "conc. H2SO4, H3PO4 or TsOH, heat, the alkene distilled off",
    yield = { 60, 90 },
    cautions = { "sulfuric acid" },
    source = MARCH,
    example { "CC1=CCCCC1", from = { "CC1CCCCC1O" } },
    refuse { "CC(C)C=C" }, -- the less substituted alkene
}

interconversion "hofmann-elimination-hydroxide" {
    about = "Hofmann elimination of a quaternary ammonium hydroxide; the less substituted alkene",
    rxno = "RXNO:0000166",
    target = "[CX3;!$(C[!#6;!#1]);$([H2]),$(*=[CX3;H2]):1]=[CX3;!$(C[!#6;!#1]):2]",
    from = "[C:1]([N+]([CH3])([CH3])[CH3])[C;!H0:2].[OH-]",
    when = function(m) return not m.molecule:has "[$([CX3]=[OX1]),$([CX4]-[OX2H1]),$([CX2]#N),$(C-[F,Cl,Br,I])]" end,
    prefer = { "hofmann", first = 1, second = 2 },
    conditions = "base-aq-strong",
    also_attacks = { "ester", "alkyl halide", "aldehyde" },
    recipe = "quaternary hydroxide (Ag2O from the iodide), heat 100-200 °C",
    yield = { 60, 85 },
    source = MARCH,
    example { "CCC=C", from = { "CCC(C)[N+](C)(C)C.[OH-]" } },
    refuse { "C=CCC(=O)O" }, -- an acceptor moves the double bond
    refuse { "CC=CC" }, -- the more substituted alkene
}

-- ---- Rearrangements ---------------------------------------------------------------------------------

interconversion "pinacol" {
    about = "Pinacol rearrangement of a 1,2-diol; the more stable cation, then aryl before alkyl",
    target = "[#6:5][CX3:1](=[OX1:2])[CX4;H0:3]([#6:6])([#6:7])[#6:4]",
    from = "[#6:5][C:1]([OH:2])([#6:4])[C:3]([OH])([#6:6])[#6:7]",
    prefer = { "pinacol rearrangement", group = 4, to = 3, carbonyl = 1 },
    conditions = "acid-aq-strong",
    also_attacks = { "free alcohol", "acetal", "silyl ether", "tert-butyl ester", "Boc amine", "epoxide" },
    recipe = "H2SO4 or I2-AcOH, 0 °C to reflux",
    yield = { 60, 85 },
    cautions = { "sulfuric acid" },
    source = CLAYDEN,
    example { "CC(=O)C(C)(C)C", from = { "CC(C)(O)C(C)(C)O" } },
    example { "CC(=O)C(C)(c1ccccc1)c1ccccc1", from = { "CC(O)(c1ccccc1)C(C)(O)c1ccccc1" } },
    refuse { "CC(=O)C(C)C" }, -- the carbon that the group goes to is not quaternary
}

interconversion "baeyer-villiger-by-aptitude" {
    about = "Baeyer-Villiger oxidation; tertiary alkyl before secondary alkyl and aryl before primary alkyl before methyl",
    target = "[#6;!$(C-[!#6;!#1]);!$(C=[O,N]);!$([CX3]=[CX3]):1][CX3:2](=[OX1:3])[OX2:4][#6;$(c),$([CX4;H0,H1]([#6])[#6]),$([CX4;R]);!$([CX4](-[!#6;!#1])-[!#6;!#1]);!$([CX4]-[CX3]=O);!$([CX4]-C#N):5]",
    from = "[#6:1][C:2](=[O:3])[#6:5]",
    when = function(m) return not m.atom[1].aromatic or m.atom[5].aromatic or m.atom[5].carbons >= 2 end,
    prefer = { "migratory aptitude", group = 5, to = 4 },
    conditions = "mcpba",
    also_attacks = { "alkene", "primary amine", "secondary amine", "tertiary amine", "thiol", "thioether", "imine",
        "aldehyde" },
    recipe = "mCPBA, NaHCO3, CH2Cl2, rt; also: CF3CO3H; H2O2",
    yield = { 65, 90 },
    cautions = { "3-chloroperbenzoic acid" },
    source = CLAYDEN,
    example { "CC(=O)Oc1ccccc1", from = { "CC(=O)c1ccccc1" } },
    example { "CC1CCCCC(=O)O1", from = { "CC1CCCCC1=O" } },
    refuse { "CC1CCCCOC1=O" }, -- the less substituted carbon moves
}

interconversion "solvolysis-with-shift" {
    about = "Solvolysis of a neopentyl-like halide with silver; the cation rearranges to the tertiary one",
    target = "[CX4;H0;$(C([OX2H])([#6])([#6])[#6]):1]([OX2H:3])[CX4;H2:2][#6:4]",
    from = "[C;H0:1]([#6:4])[CH2:2]Br.[O:3]",
    prefer = { "migratory aptitude", group = 4, to = 2 },
    conditions = "acid-aq-mild",
    also_attacks = { "alkyl halide", "acyl halide" },
    recipe = "AgNO3, H2O-EtOH, rt to reflux",
    yield = { 40, 70 },
    cautions = { "silver nitrate" },
    source = CLAYDEN,
    example { "CCC(C)(C)O", from = { "CC(C)(C)CBr", "O" } },
    refuse { "CC(C)(C)CO" }, -- no SN2 at a neopentyl carbon
}
