-- Steps: what they answer, and how they print. Steps of routes hold their molecules as text under
-- the key `core` until someone asks.
local core = ...
local methods = {}

local function read_all(list)
    local mols = {}
    for i, smiles in ipairs(list) do mols[i] = core.mol(smiles) end
    return mols
end

-- The step of the rule book that a step of a route came from, or nil: found by asking its transform
-- again. Known steps have none.
local function ask_again(text, transform)
    local rule = transform and core.find_transform(transform)
    if not rule then return nil end
    local wanted = {}
    for i, m in ipairs(read_all(text.precursors)) do wanted[i] = m:smiles() end
    table.sort(wanted)
    for _, step in ipairs(rule:back(core.mol(text.product))) do
        local found = {}
        for i, m in ipairs(step.precursors) do found[i] = m:smiles() end
        table.sort(found)
        if table.concat(found, " ") == table.concat(wanted, " ") then return step end
    end
end

-- The rule's own step, kept with the step of a route. Its precursors may stand in another order.
local function origin(step)
    local text = rawget(step, core)
    if not text then return step end
    if text.origin == nil then text.origin = ask_again(text, step.transform) or false end
    return text.origin or nil
end

local function of_origin(key)
    return function(_, step)
        local one = origin(step)
        return one and one[key] or {}
    end
end

local readers = {
    clashes = of_origin "clashes",
    worries = of_origin "worries",
    product = function(text) return core.mol(text.product) end,
    precursors = function(text) return read_all(text.precursors) end,
}

-- What else the same conditions give, worked out when it is asked for. Known steps have no rule to ask.
local function find_rivals(step)
    local t = step.transform and core.find_transform(step.transform)
    return t and core.rivals(t, step.product, table.unpack(step.precursors)) or {}
end

function core.step_type.__index(step, key)
    if key == "rivals" then
        local rivals = find_rivals(step)
        rawset(step, key, rivals)
        return rivals
    end
    local text = rawget(step, core)
    if text and readers[key] then
        local value = readers[key](text, step)
        rawset(step, key, value)
        return value
    end
    return methods[key]
end

-- Does `word` stand at the beginning of a word in `text`, whatever the case?
local function names(text, word)
    text, word = string.lower(text), string.lower(word)
    local at = string.find(text, word, 1, true)
    while at do
        if at == 1 or not string.find(string.sub(text, at - 1, at - 1), "%a") then return true end
        at = string.find(text, word, at + 1, true)
    end
    return false
end

local function any_names(list, word)
    for _, text in ipairs(list or {}) do
        if names(text, word) then return true end
    end
    return false
end

-- used = step:uses(reagent): a word of its reagents, cautions, recipe, conditions or name; or a
-- molecule among its precursors; or a pattern that fits one of them
function methods.uses(step, reagent)
    if type(reagent) == "string" then
        return any_names(step.reagents, reagent) or any_names(step.cautions, reagent)
            or any_names({ step.recipe or "", step.conditions or "", step.transform or "" }, reagent)
    end
    for _, precursor in ipairs(step.precursors) do
        if precursor == reagent then return true end
    end
    if core.is_pattern(reagent) then
        for _, precursor in ipairs(step.precursors) do
            if precursor:has(reagent) then return true end
        end
    elseif not core.is_molecule(reagent) then
        core.fail("bad value", "uses: a word, a molecule or a pattern is expected, not a "
            .. type(reagent))
    end
    return false
end

-- list = step:protections(): protecting groups that would help with its clashes, for each one those
-- that survive before those that may suffer
function methods.protections(step)
    local one = origin(step)
    return one and core.protections(one) or {}
end

local function stereo_elements(m)
    local count = 0
    for _, atom in ipairs(m:atoms()) do count = count + (atom.cip and 1 or 0) end
    for _, bond in ipairs(m:bonds()) do count = count + (bond.cip and 1 or 0) end
    return count
end

-- t = step:simplification(): by how much the hardest precursor is simpler than the product
function methods.simplification(step)
    local product = step.product
    local rings, stereo, complexity, pieces = 0, 0, 0, 0
    for _, m in ipairs(step.precursors) do
        if m:has "[#6]" then
            rings = math.max(rings, #m:rings())
            stereo = math.max(stereo, stereo_elements(m))
            complexity = math.max(complexity, m:complexity())
            pieces = pieces + 1
        end
    end
    return {
        rings = #product:rings() - rings,
        stereo = stereo_elements(product) - stereo,
        complexity = product:complexity() - complexity,
        pieces = pieces,
        halves = pieces == 1 and #step.precursors == 1 and step.equivalents[1] == 2,
    }
end

-- "a1 + d2", and whether one of them is against nature
local function labels(polarity)
    local text = "; " .. polarity.labels[1] .. " + " .. polarity.labels[2]
    return polarity.umpolung[1] and text .. ", umpolung" or text
end

-- "A + B -> P  (transform; labels of acceptor and donor)"
function core.step_type.__tostring(step)
    local text = {}
    for i, precursor in ipairs(step.precursors) do text[i] = tostring(precursor) end
    return string.format("%s -> %s  (%s%s)", table.concat(text, " + "), tostring(step.product),
        step.transform or "known", step.polarity and labels(step.polarity) or "")
end

return methods
