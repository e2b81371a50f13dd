-- The words of packs for groups and what becomes of them: group, conditions, verdict, protecting,
-- incompatible; their self-tests; and what molecules answer about clashes.
local core = ...
local check = core.module "check"
local format, sub, find = string.format, string.sub, string.find

local words, groups = {}, {}
groups.words = words

local function name_of(what, name)
    if type(name) ~= "string" then
        check.fail("%s: a name is expected, not a %s", what, type(name))
    end
    if name == "" then check.fail("%s: the name is empty", what) end
    if #name > 120 then check.fail("%s: the name is longer than 120 bytes", what) end
    if find(name, "[%c]") then check.fail("%s: a control character in the name", what) end
    return name
end

-- word "name" { ... } and word("name", { ... }); define gets a beginning for messages, too.
local function named(what, define)
    return function(name, given)
        name = name_of(what, name)
        local title = format('%s "%s"', what, name)
        if given ~= nil then return define(name, given, title) end
        return function(later) return define(name, later, title) end
    end
end

local function no_entries(what, given)
    if #check.entries(what, given) > 0 then
        check.fail("%s: named fields are expected, such as smarts = \"...\"", what)
    end
end

-- ---- Groups ----------------------------------------------------------------------------------

local group = { name = "text", smarts = "text", parents = "texts", also = "texts",
    examples = "any", non_examples = "texts", about = "text", source = "text" }

-- "CCO" or { "OCCO", 2 }
local function add_examples(what, given, tests)
    if given == nil then return end
    if type(given) == "string" then given = { given } end
    if type(given) ~= "table" then check.fail("%s: 'examples' must be a list", what) end
    for i, entry in ipairs(check.entries(what .. ": examples", given)) do
        local smiles, hits = entry, 1
        if type(entry) == "table" then smiles, hits = rawget(entry, 1), rawget(entry, 2) end
        if type(smiles) ~= "string" or math.type(hits) ~= "integer" or hits < 1 then
            check.fail("%s: example %d: SMILES or { SMILES, hits } is expected", what, i)
        end
        tests[#tests + 1] = { smiles = smiles, hits = hits }
    end
end

words.group = named("group", function(name, given, what)
    local fields = check.fields(what, given, group)
    no_entries(what, given)
    if not fields.smarts then check.fail("%s: 'smarts' is missing", what) end
    local tests = {}
    add_examples(what, fields.examples, tests)
    for _, smiles in ipairs(fields.non_examples or {}) do
        tests[#tests + 1] = { smiles = smiles, hits = 0 }
    end
    core.group { name = name, title = fields.name, smarts = fields.smarts,
        parents = fields.parents, also = fields.also, source = fields.source, tests = tests,
        origin = core.where() }
end)

-- ---- Fates -----------------------------------------------------------------------------------

local verdicts = { attacked = true, slow = true, survives = true }

-- { "a", "b", { "c", "d", why = "..." } }: lists of names with what happens to them.
local function add_fates(what, field, fate, given, fates)
    if given == nil then return end
    if type(given) == "string" then given = { given } end
    if type(given) ~= "table" then check.fail("%s: '%s' must be a list", what, field) end
    local plain = { groups = {}, fate = fate }
    for i, entry in ipairs(check.entries(format("%s: %s", what, field), given)) do
        if type(entry) == "string" then
            plain.groups[#plain.groups + 1] = entry
        else
            local where = format("%s: %s: entry %d", what, field, i)
            local why = check.fields(where, entry, { why = "text" }).why
            local list = check.entries(where, entry)
            for _, word in ipairs(list) do
                if type(word) ~= "string" then
                    check.fail("%s: names are expected, not a %s", where, type(word))
                end
            end
            fates[#fates + 1] = { groups = list, fate = fate, why = why }
        end
    end
    for key in next, given do
        if type(key) == "string" then
            check.fail("%s: %s: unknown field '%s'; a list is expected", what, field, sub(key, 1, 60))
        end
    end
    if #plain.groups > 0 then fates[#fates + 1] = plain end
end

local conditions = { name = "text", reagents = "text", used_for = "text", also = "texts",
    attacks = "any", slow = "any", survives = "any", about = "text", source = "text" }

words.conditions = named("conditions", function(name, given, what)
    local fields = check.fields(what, given, conditions)
    no_entries(what, given)
    local fates = {}
    add_fates(what, "attacks", "attacked", fields.attacks, fates)
    add_fates(what, "slow", "slow", fields.slow, fates)
    add_fates(what, "survives", "survives", fields.survives, fates)
    core.conditions { name = name, title = fields.name, reagents = fields.reagents,
        used_for = fields.used_for, also = fields.also, source = fields.source, fates = fates,
        origin = core.where() }
end)

-- verdict { group = "ester", conditions = "nabh4", "slow", why = "..." }
function words.verdict(given)
    local what = "verdict"
    local fields = check.fields(what, given,
        { group = "texts", conditions = "texts", why = "text", source = "text" })
    local entries = check.entries(what, given)
    if #entries ~= 1 or not verdicts[entries[1]] then
        check.fail("verdict: \"attacked\", \"slow\" or \"survives\" is expected, beside group and conditions")
    end
    for _, field in ipairs { "group", "conditions" } do
        if not fields[field] or #fields[field] == 0 then
            check.fail("verdict: '%s' is missing", field)
        end
    end
    core.verdict { conditions = fields.conditions,
        fates = { { groups = fields.group, fate = entries[1], why = fields.why } } }
end

local protecting = { name = "text", group = "text", like = "text", example = "text",
    guards = "texts", installed_by = "texts", install_reagents = "text", removed_by = "texts",
    removal_reagents = "text", survives = "texts", slow = "texts", attacked_by = "texts",
    remarks = "text", about = "text", source = "text" }

words.protecting = named("protecting", function(name, given, what)
    local fields = check.fields(what, given, protecting)
    no_entries(what, given)
    for _, field in ipairs { "example", "guards", "installed_by", "removed_by" } do
        if not fields[field] then check.fail("%s: '%s' is missing", what, field) end
    end
    local fates = {}
    add_fates(what, "survives", "survives", fields.survives, fates)
    add_fates(what, "slow", "slow", fields.slow, fates)
    add_fates(what, "attacked_by", "attacked", fields.attacked_by, fates)
    fields.title, fields.name, fields.fates, fields.origin = fields.name, name, fates, core.where()
    core.protecting(fields)
end)

local incompatible = { conditions = "texts", verdict = "text", why = "text", about = "text",
    source = "text" }

words.incompatible = named("incompatible", function(name, given, what)
    local fields = check.fields(what, given, incompatible)
    local lists = check.entries(what, given)
    if #lists ~= 2 then check.fail("%s: two groups, or two lists of groups, are expected", what) end
    for i, list in ipairs(lists) do
        if type(list) == "string" then list = { list } end
        lists[i] = check.fields(what, { list = list }, { list = "texts" }).list
    end
    local fate = fields.verdict or "attacked"
    if fate ~= "attacked" and fate ~= "slow" then
        check.fail("%s: 'verdict' must be \"attacked\" or \"slow\"", what)
    end
    core.incompatible { name = name, one = lists[1], other = lists[2],
        conditions = fields.conditions, fate = fate, why = fields.why, source = fields.source,
        origin = core.where() }
end)

-- ---- Self-tests --------------------------------------------------------------------------------

function groups.all()
    local list, i = {}, 0
    while true do
        local one = core.nth_group(i)
        if not one then return list end
        i = i + 1
        list[i] = one
    end
end

local function test_one(one, test)
    local ok, m = pcall(core.mol, test.smiles)
    if not ok then return format("%s cannot be read: %s", test.smiles, m.message) end
    local hits = m:count(one.smarts)
    if hits ~= test.hits then
        return format("%s has %d hit%s, not %d", test.smiles, hits, hits == 1 and "" or "s", test.hits)
    end
    for _, parent in ipairs(hits > 0 and one.parents or {}) do
        for _, wider in ipairs(groups.all()) do
            if wider.name == parent and m:count(wider.smarts) == 0 then
                return format("%s has no hit of the parent '%s'", test.smiles, parent)
            end
        end
    end
end

-- The self-tests of a group: a list of failures, and the number of tests.
function groups.test(one)
    local failures = {}
    for _, test in ipairs(one.tests) do
        local problem = test_one(one, test)
        if problem then
            failures[#failures + 1] = format("%s: %s: %s", one.origin, one.name, problem)
        end
    end
    return failures, #one.tests
end

-- Words of a transform that name no group or class of conditions: a list of failures.
function groups.check_words(t)
    local failures = {}
    for _, field in ipairs { "spares", "also_attacks" } do
        for _, word in ipairs(t[field] or {}) do
            if not core.names_group(word) then
                failures[#failures + 1] = format("%s: %s: %s: no group is called '%s'", t.origin,
                    t.name, field, word)
            end
        end
    end
    if t.conditions and not core.names_conditions(t.conditions) then
        failures[#failures + 1] = format("%s: %s: conditions: no class is called '%s'%s", t.origin,
            t.name, t.conditions, groups.meant(t.conditions))
    end
    return failures
end

-- "; did you mean 'nabh4'?" or nothing.
function groups.meant(class)
    local names, i = {}, 0
    while true do
        local one = core.nth_conditions(i)
        if not one then return check.meant(class, names) end
        i = i + 1
        names[i] = one.name
    end
end

-- clashes, cautions = m:clashes(conditions, { reacting = { atoms } })
function core.molecule_methods.clashes(m, class, given)
    if not core.is_molecule(m) then
        check.fail("clashes: a molecule is expected, not a %s", type(m))
    end
    if type(class) ~= "string" then
        check.fail("clashes: a class of conditions is expected, not a %s", type(class))
    end
    if not core.names_conditions(class) then
        core.fail("not found", format("no class of conditions '%s'%s", class, groups.meant(class)))
    end
    local fields = check.fields("clashes", given or {}, { reacting = "any" })
    local atoms = fields.reacting
    if atoms ~= nil and type(atoms) ~= "table" then
        check.fail("clashes: 'reacting' must be a list of atoms, not a %s", type(atoms))
    end
    local clashes, cautions = core.clashes(m, class, atoms)
    return clashes, cautions
end

return groups
