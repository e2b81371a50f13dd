-- The words of packs: pack, synthon, disconnection, interconversion, example, refuse.
-- They check what is written and hand plain tables to the host.
local core = ...
local check = core.module "check"
local format, sub, find = string.format, string.sub, string.find

local words = {}

local function name_of(what, name)
    if type(name) ~= "string" then
        check.fail("%s: a name is expected, not a %s", what, type(name))
    end
    if name == "" then check.fail("%s: the name is empty", what) end
    if #name > 120 then check.fail("%s: the name is longer than 120 bytes", what) end
    if find(name, "[%c]") then check.fail("%s: a control character in the name", what) end
    return name
end

-- word "name" { ... } and word("name", { ... })
local function named(what, define)
    return function(name, given, ...)
        name = name_of(what, name)
        if given ~= nil then return define(name, given) end
        return function(later) return define(name, later) end
    end
end

-- Self-tests are values of their own kind, known by this table.
local tests = setmetatable({}, { __mode = "k" })

function words.example(given)
    local fields = check.fields("example", given,
        { from = "texts", about = "text", source = "text" })
    local entries = check.entries("example", given)
    if #entries ~= 1 or type(entries[1]) ~= "string" then
        check.fail("example: one product as SMILES is expected, then from = { ... }")
    end
    if not fields.from or #fields.from == 0 then
        check.fail("example: 'from' is missing; the precursors as SMILES are expected")
    end
    local test = { { product = entries[1], from = fields.from, refuse = false } }
    tests[test] = true
    return test
end

function words.refuse(given)
    if type(given) == "string" then given = { given } end
    check.fields("refuse", given, { why = "text", about = "text" })
    local test = {}
    for i, product in ipairs(check.entries("refuse", given)) do
        if type(product) ~= "string" then
            check.fail("refuse: products as SMILES are expected, not a %s", type(product))
        end
        test[i] = { product = product, from = {}, refuse = true }
    end
    if #test == 0 then check.fail("refuse: a product as SMILES is expected") end
    tests[test] = true
    return test
end

local header = { name = "text", version = "text", licence = "text", about = "text",
    needs = "texts", authors = "texts", source = "text" }

function words.pack(given)
    local fields = check.fields("pack", given, header)
    if #check.entries("pack", given) > 0 then
        check.fail("pack: named fields are expected, such as name = \"our-bench\"")
    end
    if not fields.name then check.fail("pack: 'name' is missing") end
    name_of("pack", fields.name)
    core.header(fields)
    for _, need in ipairs(fields.needs or {}) do core.use(need) end
end

local equivalent = { attach = "text", rewrite = "text", name = "text", ionic = "flag",
    equivalents = "number", about = "text", cautions = "texts", source = "text" }

local function check_equivalent(what, given)
    if type(given) == "string" then given = { attach = given } end
    local fields = check.fields(what, given, equivalent)
    if (fields.attach == nil) == (fields.rewrite == nil) then
        check.fail("%s: either 'attach' or 'rewrite' is expected", what)
    end
    if fields.equivalents and not (fields.equivalents > 0 and fields.equivalents <= 1000) then
        check.fail("%s: 'equivalents' must be above 0", what)
    end
    return fields
end

words.synthon = named("synthon", function(name, given)
    local what = format('synthon "%s"', name)
    local fields = check.fields(what, given,
        { kind = "text", equivalents = "any", about = "text", source = "text" })
    if fields.kind ~= "donor" and fields.kind ~= "acceptor" then
        check.fail("%s: 'kind' must be \"donor\" or \"acceptor\"", what)
    end
    if type(fields.equivalents) ~= "table" then
        check.fail("%s: 'equivalents' must be a list", what)
    end
    local list = {}
    for i, one in ipairs(check.entries(what .. ": equivalents", fields.equivalents)) do
        list[i] = check_equivalent(format("%s: equivalent %d", what, i), one)
    end
    if #list == 0 then check.fail("%s: no equivalents", what) end
    core.synthon { name = name, kind = fields.kind, equivalents = list, origin = core.where() }
end)

-- preference "name" { roles = { "carbon" }, score = function(product, m) return ... end }
words.preference = named("preference", function(name, given)
    local what = format('preference "%s"', name)
    local fields = check.fields(what, given,
        { roles = "texts", score = "code", about = "text", source = "text" })
    if #check.entries(what, given) > 0 then check.fail("%s: named fields are expected", what) end
    if not fields.score then check.fail("%s: 'score' is missing, a function", what) end
    core.preference { name = name, roles = fields.roles or {}, score = fields.score,
        origin = core.where() }
end)

-- A function of the rule's own, the name of a preference, or { "name", role = map, ... }.
local function read_prefer(what, given)
    if given == nil or type(given) == "function" then return given end
    if type(given) == "string" then given = { given } end
    if type(given) ~= "table" then
        check.fail("%s: 'prefer' must be a function or name a preference, not a %s", what, type(given))
    end
    local entries = check.entries(what .. ": prefer", given)
    if #entries ~= 1 or type(entries[1]) ~= "string" then
        check.fail("%s: 'prefer' names one preference, such as { \"markovnikov\", carbon = 1 }", what)
    end
    local roles, maps = {}, {}
    for _, key in ipairs(check.sorted_texts(given)) do
        local map = given[key]
        if math.type(map) ~= "integer" or map < 1 or map > 999 then
            check.fail("%s: prefer: '%s' must be a map number", what, key)
        end
        roles[#roles + 1], maps[#maps + 1] = key, map
    end
    return { name = entries[1], roles = roles, maps = maps }
end

-- addition = { "syn", 1, 2 } or { "anti", 1, 2 }
local function read_addition(what, given)
    if given == nil then return nil end
    local fault = '%s: \'addition\' must be { "syn", map, map } or { "anti", map, map }'
    if type(given) ~= "table" then check.fail(fault, what) end
    local way, a, b = rawget(given, 1), rawget(given, 2), rawget(given, 3)
    if (way ~= "syn" and way ~= "anti") or math.type(a) ~= "integer" or math.type(b) ~= "integer"
        or a < 1 or b < 1 or a > 999 or b > 999 then
        check.fail(fault, what)
    end
    return { way = way, maps = { a, b } }
end

local transform = { target = "text", from = "any", cut = "maps", acceptor = "stop", donor = "stop",
    conditions = "text", recipe = "text", yield = "percent", step_cost = "number",
    spares = "texts", also_attacks = "texts", cautions = "texts", reagents = "texts",
    source = "text", rxno = "text", also = "texts", when = "code", prefer = "any", addition = "any",
    about = "text" }

-- The self-tests among the numbered entries of a definition.
local function collect_tests(what, given)
    local list = {}
    for i, test in ipairs(check.entries(what, given)) do
        if type(test) ~= "table" or not tests[test] then
            check.fail("%s: entry %d is neither an example nor a refuse", what, i)
        end
        for _, one in ipairs(test) do list[#list + 1] = one end
    end
    return list
end

local function define_transform(kind, name, given)
    local what = format('%s "%s"', kind, name)
    local fields = check.fields(what, given, transform)
    fields.examples = collect_tests(what, given)
    if not fields.target then check.fail("%s: 'target' is missing", what) end
    if type(fields.from) == "table" then
        fields.from = table.concat(check.entries(what .. ": from", fields.from), ".")
    end
    if fields.from ~= nil and type(fields.from) ~= "string" then
        check.fail("%s: 'from' must be a string", what)
    end
    if not fields.from then
        if kind == "interconversion" then check.fail("%s: 'from' is missing", what) end
        for _, field in ipairs { "cut", "acceptor", "donor" } do
            if not fields[field] then
                check.fail("%s: '%s' is missing (or 'from', to write out the precursors)", what,
                    field)
            end
        end
    elseif fields.cut or fields.acceptor or fields.donor then
        check.fail("%s: either 'from' or 'cut' with acceptor and donor is expected", what)
    end
    if fields.step_cost and not (fields.step_cost >= 0 and fields.step_cost < math.huge) then
        check.fail("%s: 'step_cost' must be 0 or more", what)
    end
    fields.prefer = read_prefer(what, fields.prefer)
    fields.addition = read_addition(what, fields.addition)
    fields.name, fields.kind, fields.origin = name, kind, core.where()
    local index = core.transform(fields)
    if not core.packed then return core.nth_transform(index) end
end

words.disconnection = named("disconnection", function(name, given)
    return define_transform("disconnection", name, given)
end)

words.interconversion = named("interconversion", function(name, given)
    return define_transform("interconversion", name, given)
end)

return words
