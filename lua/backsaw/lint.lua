-- Lint of one pack that is in use: what its self-tests do not show. A finding has level ("warning",
-- or "note" for what may well be meant), kind, rule, where and text.
local core = ...
local study = core.module "study"
local transforms = core.module "transform"
local lint = {}
local format = string.format

-- ---- What is missing ---------------------------------------------------------------------------

-- Examples and refusals among the self-tests of a transform.
local function count_tests(one)
    local examples, refusals = 0, 0
    for _, test in ipairs(one.tests) do
        if test.refuse then refusals = refusals + 1 else examples = examples + 1 end
    end
    return examples, refusals
end

local function missing(one, add)
    local examples, refusals = count_tests(one)
    local function say(what, text) add("warning", "missing-" .. what, text) end
    if examples == 0 then say("example", "no example") end
    if refusals == 0 then say("refuse", "no refuse: nothing shows where the rule must not be used") end
    if not one.conditions then say("conditions", "no class of conditions: clashes are not seen") end
    if not one.recipe then say("recipe", "no recipe") end
    if not one.source then say("source", "no source") end
end

-- ---- Targets that fit nearly anything ------------------------------------------------------------

-- Small compounds of many classes; chosen here, there is no source.
local common = { "CCO", "CC(C)=O", "c1ccccc1", "CCOC(C)=O", "CCN", "CCC#N", "C1CCCCC1", "CCCC=C",
    "c1ccncc1", "CNC(C)=O", "CCCCl", "OCC(O)CO", "CS(C)=O", "Cc1ccc2ccccc2c1", "CCC(=O)O",
    "Cc1ccccc1", "C1CCOC1", "CCSCC", "CCC#C", "NCC(=O)O" }

local function fits(target)
    local pattern, count = core.pattern(target), 0
    for _, smiles in ipairs(common) do
        if core.mol(smiles):has(pattern) then count = count + 1 end
    end
    return count
end

local function wide(one, add)
    local count = fits(one.target)
    if count * 3 >= #common * 2 then
        add("warning", "wide-target", format("the target fits %d of %d common compounds%s", count,
            #common, one.when and "; 'when' alone holds it back" or ""))
    end
end

-- ---- Rules that are alike --------------------------------------------------------------------------

-- A text of patterns with maps numbered as they come.
local function plain(text)
    local maps, count = {}, 0
    return (string.gsub(text, ":(%d+)%]", function(map)
        if not maps[map] then
            count = count + 1
            maps[map] = tostring(count)
        end
        return ":" .. maps[map] .. "]"
    end))
end

-- What a rule does: two with the same text do the same.
local function deed(one)
    if one.from then return plain(one.target .. ">>" .. one.from) end
    local ends = format("[x:%d]-[x:%d]", one.acceptor_map, one.donor_map)
    return plain(one.target .. ">" .. ends .. ">") .. study.fold(one.acceptor .. ">" .. one.donor)
end

local function guarded(one) return one.when or one.prefer end

local function duplicates(list, add_to)
    local seen = {}
    for _, one in ipairs(list) do
        local key = deed(one)
        local other = seen[key]
        if other then
            local meant = guarded(one) or guarded(other)
            add_to(one, meant and "note" or "warning", "duplicate", format(
                "the same target and precursors as '%s'%s", other.name,
                meant and "; their functions may tell them apart" or ""))
        else
            seen[key] = one
        end
    end
end

-- The first of two rules that undo each other by their very texts is named by the second.
local function inverses(list, add_to)
    local seen = {}
    for _, one in ipairs(list) do
        if one.from then
            local other = seen[plain(one.from .. ">>" .. one.target)]
            if other then
                add_to(one, "note", "inverse", format("the inverse of '%s': their patterns are swapped",
                    other.name))
            end
            seen[plain(one.target .. ">>" .. one.from)] = one
        end
    end
end

-- Does `other` make the product of an example from the same precursors?
local function also_makes(other, product, wanted)
    if not product:has(other.pattern) then return false end
    for _, step in ipairs(other.rule:back(product)) do
        if transforms.pieces(step.precursors) == wanted then return true end
    end
    return false
end

local function overlap_of(one, test, list, add_to)
    local product = core.mol(test.product)
    local wanted = transforms.pieces(test.from)
    for _, other in ipairs(list) do
        if other ~= one and also_makes(other, product, wanted) then
            add_to(one, "note", "overlap", format("'%s' makes its example %s from the same precursors",
                other.name, test.product))
        end
    end
end

-- Examples that cannot be read, or functions that fail, are the business of the self-tests.
local function overlaps(list, add_to)
    for _, one in ipairs(list) do one.pattern = core.pattern(one.target) end
    for _, one in ipairs(list) do
        for _, test in ipairs(one.tests) do
            if not test.refuse then pcall(overlap_of, one, test, list, add_to) end
        end
    end
end

-- ---- Synthons --------------------------------------------------------------------------------------

local function unused_synthons(pack, add)
    local used = {}
    for _, t in ipairs(transforms.all()) do
        local one = core.describe(t)
        if one.acceptor then used[study.fold(one.acceptor)] = true end
        if one.donor then used[study.fold(one.donor)] = true end
    end
    for _, one in ipairs(study.synthons_of(pack)) do
        if not used[study.fold(one.name)] then
            add { level = "warning", kind = "unused-synthon", rule = one.name, where = one.origin,
                text = "no disconnection in use has this synthon" }
        end
    end
end

-- ---- The whole -------------------------------------------------------------------------------------

-- The findings on a pack, and its table of coverage.
function lint.pack(pack)
    local findings, coverage, list = {}, {}, study.transforms_of(pack)
    local function add(finding) findings[#findings + 1] = finding end
    local function add_to(one, level, kind, text)
        add { level = level, kind = kind, rule = one.name, where = one.origin, text = text }
    end
    for _, one in ipairs(list) do
        local function to_this(...) add_to(one, ...) end
        missing(one, to_this)
        wide(one, to_this)
        local examples, refusals = count_tests(one)
        coverage[#coverage + 1] = { rule = one.name, examples = examples, refusals = refusals,
            conditions = one.conditions, source = one.source }
    end
    duplicates(list, add_to)
    inverses(list, add_to)
    overlaps(list, add_to)
    unused_synthons(pack, add)
    return findings, coverage
end

return lint
