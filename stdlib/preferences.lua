-- Which product is the major one: shared rules, each by the roles that atoms have in it. Rules of any pack may name them:
-- prefer = { "markovnikov", carbon = 1 }. A score is compared only with those of other products of the same reactants.
-- Rules of thumb of the textbooks; the numbers order products and predict no ratios. From memory unless a source says otherwise.

pack {
    name = "preferences",
    version = "0.1.0",
    licence = "CC0-1.0",
    about = "Which product is the major one: shared rules for the other packs",
}

local NEVER = -1000

-- ---- What the rules ask -----------------------------------------------------------------------

local function cation(m, atom) return m.molecule:stability(atom.index, "cation") end
local function radical(m, atom) return m.molecule:stability(atom.index, "radical") end
local function anion(m, atom) return m.molecule:stability(atom.index, "anion") end

-- The neighbours of an atom, the given ones left out.
local function others(m, atom, ...)
    local list, left_out = {}, {}
    for _, one in ipairs { ... } do left_out[one.index] = true end
    for _, near in ipairs(m.molecule:neighbours(atom.index)) do
        if not left_out[near.index] then list[#list + 1] = near end
    end
    return list
end

-- How crowded a carbon is: its carbon neighbours, and those that are themselves branched.
local function crowding(m, atom, ...)
    local sum = 0
    for _, near in ipairs(others(m, atom, ...)) do
        if near.element == "C" then
            sum = sum + 1
            if not near.aromatic and near.degree - (near.order > 1 and 1 or 0) > 3 then sum = sum + 0.8 end
        elseif near.element == "Si" or near.element == "Sn" then
            sum = sum + 1
        end
    end
    return sum
end

-- A double bond, a triple bond or a ring that conjugates with the atom, but for the bonds between the given ones.
local function conjugation(m, atom, ...)
    local count = 0
    for _, near in ipairs(others(m, atom, ...)) do
        if near.aromatic then
            count = count + 1
        elseif near.element == "C" then
            for _, far in ipairs(m.molecule:neighbours(near.index)) do
                if far.index ~= atom.index and far.order > 1 then count = count + 1 break end
            end
        end
    end
    return count
end

-- Carbons on a double bond: the more, the more stable, and conjugation counts more.
local function alkene_stability(m, first, second)
    return #others(m, first, second) + #others(m, second, first)
        + 1.5 * (conjugation(m, first, second) + conjugation(m, second, first))
end

-- ---- Additions to alkenes ---------------------------------------------------------------------

preference "markovnikov" {
    about = "Ionic addition: the nucleophile ends where the cation is the more stable one",
    roles = { "carbon" }, -- that gets the nucleophile
    source = "Clayden, Greeves, Warren, Organic Chemistry; from memory",
    score = function(product, m) return cation(m, m.atom.carbon) end,
}

preference "anti-markovnikov" {
    about = "Hydroboration: boron, later OH, on the less hindered carbon; less substituted and electron-rich alkenes first",
    roles = { "carbon", "hydrogen" }, -- that gets boron; that gets hydrogen
    source = "H. C. Brown's work on hydroboration; from memory",
    score = function(product, m)
        return -2 * crowding(m, m.atom.carbon) - 0.2 * crowding(m, m.atom.hydrogen) + 0.3 * cation(m, m.atom.hydrogen)
    end,
}

preference "radical addition" {
    about = "Radical chain: the radical adds where it leaves the more stable radical",
    roles = { "carbon", "hydrogen" }, -- that gets the radical; that gets hydrogen from the chain
    source = "Clayden, Greeves, Warren, Organic Chemistry; from memory",
    score = function(product, m) return radical(m, m.atom.hydrogen) - crowding(m, m.atom.carbon) end,
}

preference "electron-rich alkene" {
    about = "Electrophiles take the alkene with more alkyl groups, away from electron-poor groups and allylic oxygen",
    roles = { "first", "second" },
    source = "Clayden, Greeves, Warren, Organic Chemistry; from memory",
    score = function(product, m)
        local first, second = m.atom.first, m.atom.second
        local sum = cation(m, first) + cation(m, second)
        for _, pair in ipairs { { first, second }, { second, first } } do
            for _, near in ipairs(others(m, pair[1], pair[2])) do
                if near.element == "C" and not near.aromatic then
                    for _, far in ipairs(m.molecule:neighbours(near.index)) do
                        if far.element == "O" or far.element == "N" or far.element == "F" or far.element == "Cl"
                            or far.element == "Br" then
                            sum = sum - 0.7
                        end
                    end
                end
            end
        end
        return sum
    end,
}

preference "less hindered alkene" {
    about = "Hydrogenation and other reactions on a metal take the alkene with fewer groups",
    roles = { "first", "second" },
    source = "March's Advanced Organic Chemistry; from memory",
    score = function(product, m)
        return -crowding(m, m.atom.first, m.atom.second) - crowding(m, m.atom.second, m.atom.first)
    end,
}

-- ---- Eliminations -------------------------------------------------------------------------------

preference "zaitsev" {
    about = "The more substituted, conjugated alkene",
    roles = { "first", "second" },
    source = "Clayden, Greeves, Warren, Organic Chemistry; from memory",
    score = function(product, m) return alkene_stability(m, m.atom.first, m.atom.second) end,
}

preference "hofmann" {
    about = "A bulky base or leaving group: the less substituted alkene, unless the other one is conjugated",
    roles = { "first", "second" },
    source = "March's Advanced Organic Chemistry; from memory",
    score = function(product, m)
        local first, second = m.atom.first, m.atom.second
        return 5 * (conjugation(m, first, second) + conjugation(m, second, first))
            - #others(m, first, second) - #others(m, second, first)
    end,
}

-- ---- Substitution at saturated carbon -------------------------------------------------------------

preference "sn2" {
    about = "Methyl before primary before secondary carbon; allylic and benzylic ones first; neopentyl and tertiary ones not",
    roles = { "carbon", "nucleophile" },
    source = "Clayden, Greeves, Warren, Organic Chemistry; from memory",
    score = function(product, m)
        local carbon, nucleophile = m.atom.carbon, m.atom.nucleophile
        if carbon.aromatic or #others(m, carbon, nucleophile) > 3 then return NEVER end
        local activated = math.min(conjugation(m, carbon, nucleophile), 1)
        return 1.6 * activated - crowding(m, carbon, nucleophile)
    end,
}

preference "sn1" {
    about = "The carbon that makes the more stable cation",
    roles = { "carbon", "nucleophile" },
    source = "Clayden, Greeves, Warren, Organic Chemistry; from memory",
    score = function(product, m)
        return m.molecule:stability(m.atom.carbon.index, "cation", m.atom.nucleophile.index)
    end,
}

preference "epoxide opening by acid" {
    about = "The nucleophile ends on the carbon that bears the positive charge better",
    roles = { "carbon", "nucleophile" },
    source = "Clayden, Greeves, Warren, Organic Chemistry; from memory",
    score = function(product, m)
        return m.molecule:stability(m.atom.carbon.index, "cation", m.atom.nucleophile.index)
    end,
}

preference "epoxide opening by base" {
    about = "A strong nucleophile attacks the less hindered carbon",
    roles = { "carbon", "nucleophile" },
    source = "Clayden, Greeves, Warren, Organic Chemistry; from memory",
    score = function(product, m) return -crowding(m, m.atom.carbon, m.atom.nucleophile) end,
}

preference "less hindered alcohol" {
    about = "Bulky reagents take primary before secondary before tertiary alcohols",
    roles = { "carbon" }, -- that bears the oxygen
    source = "Clayden, Greeves, Warren, Organic Chemistry; from memory",
    score = function(product, m) return -crowding(m, m.atom.carbon) end,
}

preference "nucleophilic nitrogen" {
    about = "Acyl, sulfonyl and carbonyl groups go to the more basic, less hindered nitrogen",
    roles = { "nitrogen", "carbon" }, -- what it attacks
    source = "common practice, no source",
    score = function(product, m)
        local sum = 0
        for _, near in ipairs(others(m, m.atom.nitrogen, m.atom.carbon)) do
            sum = sum - (near.aromatic and 3 or 0) - (near.element ~= "C" and 1 or 0)
            if near.element == "C" and not near.aromatic then
                sum = sum - 0.3 * (near.carbons - 1) * (near.carbons > 1 and 1 or 0)
                for _, far in ipairs(m.molecule:neighbours(near.index)) do
                    if far.order > 1 and (far.element == "O" or far.element == "S" or far.element == "N") then
                        sum = sum - 8
                    end
                end
            end
        end
        return sum
    end,
}

-- ---- Aromatic substitution ------------------------------------------------------------------------

-- What the reaction has put on a ring carbon: the neighbour outside of the ring.
local function newcomer(m, carbon)
    for _, near in ipairs(m.molecule:neighbours(carbon.index)) do
        if not near.ring then return near.index end
    end
end

local function arene(attack, bulk)
    return function(product, m)
        local carbon = m.atom.carbon
        if not carbon.aromatic then return NEVER end
        return m.molecule:rate(carbon.index, attack, newcomer(m, carbon), bulk)
    end
end

preference "aromatic electrophilic, small" {
    about = "Directing effects of all groups and hetero atoms; a small electrophile goes ortho and para alike",
    roles = { "carbon" }, -- the ring carbon
    source = "Wheland 1942; Brown and Okamoto 1958; from memory",
    score = arene("electrophile", 0.4),
}

preference "aromatic electrophilic" {
    about = "Directing effects of all groups and hetero atoms, hindrance included",
    roles = { "carbon" },
    source = "Wheland 1942; Brown and Okamoto 1958; from memory",
    score = arene("electrophile", 1),
}

preference "aromatic electrophilic, bulky" {
    about = "The same for a large electrophile, which keeps away from the ortho position",
    roles = { "carbon" },
    source = "Wheland 1942; Brown and Okamoto 1958; from memory",
    score = arene("electrophile", 3),
}

preference "aromatic nucleophilic" {
    about = "The leaving group that is activated best; fluorine leaves before chlorine",
    roles = { "carbon" },
    source = "Clayden, Greeves, Warren, Organic Chemistry; from memory",
    score = function(product, m)
        local carbon = m.atom.carbon
        if not carbon.aromatic then return NEVER end
        return m.molecule:rate(carbon.index, "nucleophile", newcomer(m, carbon), 0.3) - 2 * m.molecule:count "cF"
    end,
}

-- What directs a base to the place beside it, the strongest first.
local DIRECTORS = {
    { pattern "[c]~[c]OC(=O)N", 6 }, { pattern "[c]~[c]C(=O)[NX3]([#6])[#6]", 5.5 }, { pattern "[c]~[c]C(=O)[NX3H]", 5.2 },
    { pattern "[c]~[c]S(=O)(=O)N", 5.2 }, { pattern "[c]~[c]C1=NCCO1", 5 }, { pattern "[c]~[c]C1=NC(C)(C)CO1", 5 },
    { pattern "[c]~[c][NX3H]C(=O)", 4.8 }, { pattern "[c]~[c]OCO[CH3]", 4.6 }, { pattern "[c]~[c]F", 3.2 },
    { pattern "[c]~[c]O[CX4]", 3.5 }, { pattern "[c]~[c]C(F)(F)F", 2.4 }, { pattern "[c]~[c]Cl", 2.4 },
    { pattern "[c]~[c]CN([#6])[#6]", 2.2 }, { pattern "[c]~[nX3;R]", 2.5 }, { pattern "[c]~[o,s]", 4 },
}

preference "ortho lithiation" {
    about = "The place beside the strongest director, better between two",
    roles = { "carbon" },
    source = "V. Snieckus, Chem. Rev. 1990, 90, 879; from memory",
    score = function(product, m)
        local sum, at = 0, m.atom.carbon.index
        if not m.atom.carbon.aromatic then return NEVER end
        for _, director in ipairs(DIRECTORS) do
            for _, hit in ipairs(m.molecule:find(director[1])) do
                if hit[1] == at then sum = sum + director[2] end
            end
        end
        return sum
    end,
}

preference "birch reduction" {
    about = "Donors end on a double bond, acceptors on a saturated carbon",
    roles = { "first", "second" }, -- the two carbons that become saturated
    source = "Clayden, Greeves, Warren, Organic Chemistry; from memory",
    score = function(product, m)
        local sum = 0
        for _, atom in ipairs { m.atom.first, m.atom.second } do
            for _, near in ipairs(m.molecule:neighbours(atom.index)) do
                if near.order == 1 and not near.ring then
                    sum = sum + anion(m, atom)
                    break
                end
            end
        end
        return sum
    end,
}

-- ---- Enolates --------------------------------------------------------------------------------------

preference "kinetic enolate" {
    about = "Strong hindered base, cold: the least substituted place, where a proton is easiest to reach",
    roles = { "carbon", "new" }, -- the carbon beside the carbonyl group, and what it gets
    source = "Clayden, Greeves, Warren, Organic Chemistry; from memory",
    score = function(product, m) return -#others(m, m.atom.carbon, m.atom.new) end,
}

preference "thermodynamic enolate" {
    about = "Weak base, warm, or acid: the more substituted, conjugated enolate or enol",
    roles = { "carbon", "new" },
    source = "Clayden, Greeves, Warren, Organic Chemistry; from memory",
    score = function(product, m)
        local carbon, new = m.atom.carbon, m.atom.new
        return #others(m, carbon, new) + 2 * math.max(conjugation(m, carbon, new) - 1, 0)
    end,
}

preference "most acidic hydrogen" {
    about = "The carbon whose anion is stabilised best",
    roles = { "carbon", "new" },
    source = "Clayden, Greeves, Warren, Organic Chemistry; from memory",
    score = function(product, m)
        return m.molecule:stability(m.atom.carbon.index, "anion", m.atom.new.index)
    end,
}

preference "last deprotonated" {
    about = "A dianion reacts at the place that was deprotonated last: the least acidic one",
    roles = { "carbon", "new" },
    source = "Clayden, Greeves, Warren, Organic Chemistry; from memory",
    score = function(product, m)
        return -m.molecule:stability(m.atom.carbon.index, "anion", m.atom.new.index)
    end,
}

-- ---- Carbonyl groups -------------------------------------------------------------------------------

preference "electrophilic carbonyl" {
    about = "Aldehyde before ketone, the less hindered first; electron-poor ones first, conjugated ones last",
    roles = { "carbon", "new" }, -- that was the carbonyl carbon, and what it gets (or its oxygen)
    source = "Clayden, Greeves, Warren, Organic Chemistry; from memory",
    score = function(product, m)
        local carbon = m.atom.carbon
        return -2 * crowding(m, carbon, m.atom.new) - conjugation(m, carbon, m.atom.new)
    end,
}

-- ---- Migrations -------------------------------------------------------------------------------------

-- Tertiary alkyl before secondary alkyl and aryl before primary alkyl before methyl; hydrogen is not asked for.
local function aptitude(m, group, centre)
    local molecule = m.molecule
    if group.aromatic then
        return 2.4 + 0.15 * molecule:rate(group.index, "electrophile", centre.index, 0)
    end
    local near = #others(m, group, centre)
    return ({ [0] = 0, 1.2, 2.4, 3.6 })[math.min(near, 3)] + 0.4 * math.min(conjugation(m, group, centre), 1)
end

preference "migratory aptitude" {
    about = "Tertiary alkyl before secondary alkyl and aryl before primary alkyl before methyl",
    roles = { "group", "to" }, -- the atom that moves, and where it goes
    source = "Clayden, Greeves, Warren, Organic Chemistry; from memory",
    score = function(product, m) return aptitude(m, m.atom.group, m.atom.to) end,
}

preference "pinacol rearrangement" {
    about = "The more stable cation first, then aryl before alkyl",
    roles = { "group", "to", "carbonyl" },
    source = "Clayden, Greeves, Warren, Organic Chemistry; from memory",
    score = function(product, m)
        local to, group = m.atom.to, m.atom.group
        return 3 * m.molecule:stability(to.index, "cation", m.atom.carbonyl.index) - 3 * (group.aromatic and 2.4 or 1)
            + aptitude(m, group, to)
    end,
}

-- ---- Radicals, rings ---------------------------------------------------------------------------------

preference "radical halogenation" {
    about = "The carbon that makes the more stable radical: benzylic and allylic before tertiary before secondary",
    roles = { "carbon", "new" },
    source = "Clayden, Greeves, Warren, Organic Chemistry; from memory",
    score = function(product, m)
        if m.atom.carbon.aromatic then return NEVER end
        return m.molecule:stability(m.atom.carbon.index, "radical", m.atom.new.index)
    end,
}

-- Which end of a diene bonds first: the one that leaves the better allyl cation.
preference "diels-alder" {
    about = "Ortho and para rule: the most nucleophilic end of the diene bonds with the most electrophilic end of the dienophile",
    roles = { "first", "near", "far", "last", "active", "other" }, -- diene 1 to 4; dienophile: with the acceptor, without
    source = "I. Fleming, Frontier Orbitals and Organic Chemical Reactions; from memory",
    score = function(product, m)
        local a = m.atom
        -- `last` bonds to `active`, `first` to `other`: the diene's cation then lies on `near` and `last`'s side.
        local function pull(atom, ...)
            local sum = 0
            for _, near in ipairs(others(m, atom, ...)) do
                if near.element == "O" or near.element == "N" or near.element == "S" then
                    sum = sum + 3
                elseif near.element == "C" or near.element == "Si" then
                    sum = sum + 1
                end
            end
            return sum
        end
        local ends = m.molecule:stability(a.active.index, "anion", a.last.index)
            - m.molecule:stability(a.other.index, "anion", a.first.index)
        -- attack by `first` leaves charge on `near` and `last`
        local charge = pull(a.near, a.first, a.far) + pull(a.last, a.far, a.active)
            - pull(a.far, a.near, a.last) - pull(a.first, a.near, a.other)
        return (ends > 0 and 1 or ends < 0 and -1 or 0) * charge
    end,
}
