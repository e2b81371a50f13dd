-- Which product is the major one: textbook cases (Clayden, Greeves, Warren; March; Carey and Sundberg; from memory, as each
-- case says). A case passes if one transform whose recipe fits the case's reagents gives one of the accepted products as
-- expected major product, and none of those that must not come out as expected.
-- Usage: backsaw regioselectivity.lua CASES LEAST [ID...]

local file = assert(io.open(arg[1]))
local text = file:read "a"
file:close()
local least = tonumber(arg[2])
local chosen, any_chosen = {}, arg[3] ~= nil
for i = 3, #arg do chosen[arg[i]] = true end

-- ---- JSON: objects, lists and strings are all that the file has --------------------------------------

local read

local function read_string(at)
    local stop = at + 1
    while text:sub(stop, stop) ~= '"' do
        stop = stop + (text:sub(stop, stop) == "\\" and 2 or 1)
    end
    return text:sub(at + 1, stop - 1):gsub("\\(.)", "%1"), stop + 1
end

local function read_items(at, close, item)
    at = text:find("%S", at + 1)
    while text:sub(at, at) ~= close do
        at = text:find("%S", item(at))
        if text:sub(at, at) == "," then at = text:find("%S", at + 1) end
    end
    return at + 1
end

function read(at)
    local first, value = text:sub(at, at), {}
    if first == '"' then return read_string(at) end
    if first == "[" then
        return value, read_items(at, "]", function(here)
            value[#value + 1], here = read(here)
            return here
        end)
    end
    assert(first == "{", "an object, a list or a string is expected at byte " .. at)
    return value, read_items(at, "}", function(here)
        local key
        key, here = read_string(here)
        value[key], here = read(text:find("[^%s:]", here))
        return here
    end)
end

local cases = read(text:find "{").cases

-- ---- Reagents ------------------------------------------------------------------------------------

-- Compounds that a case's reagents name and the rules want among the reactants, where they are not written out in full.
local COMPOUNDS = { { "MeLi", "[Li]C" }, { "Me2CuLi", "[Li]C" }, { "Me2CuLi", "C[Mg]Br" } }

-- Words that mean the same reagent or the same conditions.
local SAME = {
    ["dilute H2SO4"] = "H2SO4", ["conc. H2SO4"] = "H2SO4", ["fuming HNO3"] = "HNO3", ["H3O+"] = "acid", ["H+"] = "acid",
    NaOEt = "ethoxide", ["dibenzoyl peroxide"] = "peroxide", ["no peroxide"] = "HBr", disiamylborane = "borane",
    ["9-BBN"] = "borane", ["BH3.THF"] = "borane", ["BH3·THF"] = "borane", ["Me2CuLi"] = "cuprate",
}

-- Whether the recipe, the conditions or the cautions of a transform name a reagent of the case. Solvents and
-- temperatures say nothing, but where a case has only those, any recipe will do.
local IDLE = { "^heat$", "^light$", "°C", "equiv", "^THF$", "^Et2O$", "^toluene$", "^EtOH$", "^MeOH$", "^H2O$", "^CH2Cl2$",
    "^AcOH$", "^DMSO$", "^DMF$", "^tBuOH$", "^then H2O$", "^then NaOH$", "^cat%.$", "^salt%-free$", "^then H3O%+$" }

local function words_of(reagents)
    local words = {}
    for word in reagents:gsub("%s*%(cat%.?%)", ""):gmatch "[^,;]+" do
        word = word:match "^%s*(.-)%s*$":gsub("^then ", ""):gsub(" catalyst$", "")
        local idle = false
        for _, pattern in ipairs(IDLE) do idle = idle or word:find(pattern) ~= nil end
        if not idle then words[#words + 1] = SAME[word] or word end
    end
    return words
end

local function fits(name, words)
    local t = transform(name)
    local said = { t.recipe or "", t.conditions or "", table.concat(t.cautions, " "), t.name, table.concat(t.also, " ") }
    local all = table.concat(said, " "):lower()
    for word, meaning in pairs(SAME) do
        if all:find(word:lower(), 1, true) then all = all .. " " .. meaning:lower() end
    end
    for _, word in ipairs(words) do
        if all:find(word:lower(), 1, true) then return true end
    end
    return #words == 0
end

-- ---- Comparing ---------------------------------------------------------------------------------

-- The SMILES under which a product is compared, and that of its mirror image.
local function mirror(smiles)
    return mol((smiles:gsub("@+", { ["@"] = "@@", ["@@"] = "@" }))):smiles()
end

local function key_of(m, stereo)
    if stereo == "ignored" or stereo == "none" then return m:smiles "plain" end
    local smiles = m:smiles()
    if stereo == "absolute" then return smiles end
    local other = mirror(smiles)
    return smiles < other and smiles or other
end

local function has(products, list, stereo)
    for _, wanted in ipairs(list) do
        local key = key_of(mol(wanted), stereo)
        for _, m in ipairs(products) do
            if key_of(m, stereo) == key then return true end
        end
    end
    return false
end

-- By transform: whether the first expected set is an accepted one, and any expected one is forbidden.
local function judge(case, reactants)
    local words, order, seen, remarks = words_of(case.reagents), {}, {}, {}
    for _, set in ipairs(forth(table.unpack(reactants))) do
        local one = seen[set.transform]
        if not one then
            one = { name = set.transform, fits = fits(set.transform, words) }
            seen[set.transform], order[#order + 1] = one, one
        end
        if set.expected then
            one.good = one.good or has(set.products, case.major, case.stereo)
            one.bad = one.bad or has(set.products, case.never, case.stereo)
        end
    end
    for _, one in ipairs(order) do
        if one.good and not one.bad and one.fits then return one.name end
        if one.good or one.bad then
            remarks[#remarks + 1] = one.name .. (one.bad and " gives the wrong one" or "")
                .. (one.good and " gives it" or "") .. (one.fits and "" or " with other reagents")
        end
    end
    return nil, #remarks > 0 and table.concat(remarks, "; ") or "nothing gives it"
end

local function try(case)
    local reactants = {}
    for i, smiles in ipairs(case.reactants) do reactants[i] = mol(smiles) end
    local name, remark = judge(case, reactants)
    for _, entry in ipairs(COMPOUNDS) do
        if not name and case.reagents:find(entry[1], 1, true) then
            local more = table.move(reactants, 1, #reactants, 1, {})
            more[#more + 1] = mol(entry[2])
            name, remark = judge(case, more)
        end
    end
    return name, remark
end

local right, tried, failing = 0, 0, {}
for _, case in ipairs(cases) do
    if not any_chosen or chosen[case.id] then
        local name, remark = try(case)
        tried = tried + 1
        if name then
            right = right + 1
            if any_chosen then print(case.id, name) end
        else
            failing[#failing + 1] = case.id
            print(string.format("%s  %s, %s (%s): %s", case.id, case.class, table.concat(case.reactants, " + "),
                case.reagents, remark))
        end
    end
end
print(string.format("%d of %d cases right", right, tried))
if right < least then
    io.stderr:write(string.format("expected at least %d; failing: %s\n", least, table.concat(failing, ", ")))
    os.exit(1)
end
