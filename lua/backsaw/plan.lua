-- plan { ... }: checks what is wanted, makes plain options of it, and hands them to the search.
-- Also what lists of routes answer beyond what the host gives them.
local core = ...
local check = core.module "check"
local transforms = core.module "transform"
local constraints = core.module "constraint"
local planning = {}

local fields = { target = "any", catalogue = "any", limits = "any", cost = "any", allow = "code",
    keep = "code", rank = "code", guess = "code", known = "any", transforms = "any",
    constraints = "any", clashes = "text", clash_cost = "amount",
    strategy = "text", diverse = "amount", best = "count", at_hand = "any",
    quiet = "flag", trace = "text", threads = "count" }

local limit_fields = { depth = "count", steps = "count", molecules = "count", seconds = "amount",
    memory = "count" }

local known_fields = { product = "any", from = "any", equiv = "any", cost = "amount",
    yield = "any", name = "text", conditions = "text", recipe = "text", source = "text",
    reagents = "texts", cautions = "texts" }

-- A molecule from a molecule or SMILES, with a message that says where it stands.
local function molecule(what, value)
    if core.is_molecule(value) then return value end
    if type(value) ~= "string" then
        check.fail("%s: a molecule or SMILES is expected, not a %s", what, type(value))
    end
    return core.mol(value)
end

-- An entry of a list: a molecule at a price of 1 a mole, or { molecule, per_mole = ... }.
local function offer(what, entry)
    if type(entry) ~= "table" then return { molecule(what, entry), 1 } end
    local given = check.fields(what, entry, { per_mole = "amount" })
    local list = check.entries(what, entry)
    if #list ~= 1 then check.fail("%s: one molecule is expected", what) end
    return { molecule(what, list[1]), given.per_mole or 1 }
end

local function offers(what, list)
    local result = {}
    check.fields(what, list, {})
    for i, entry in ipairs(check.entries(what, list)) do
        result[i] = offer(string.format("%s: entry %d", what, i), entry)
    end
    return result
end

-- Has a table entries only, and no fields?
local function is_list(t)
    for key in next, t do
        if type(key) == "string" then return false end
    end
    return true
end

-- The sources of a plan, in order of preference. Entries for single compounds that stand side by
-- side make one source.
local function sources(given)
    if given == nil then return {} end
    if core.is_catalogue(given) then return { given } end
    if type(given) ~= "table" then
        check.fail("plan: 'catalogue' must be a catalogue or a list, not a %s", type(given))
    end
    check.fields("plan: catalogue", given, {})
    local result, open = {}, nil
    for i, entry in ipairs(check.entries("plan: catalogue", given)) do
        local what = string.format("plan: catalogue: entry %d", i)
        if core.is_catalogue(entry) then
            result[#result + 1], open = entry, nil
        elseif type(entry) == "table" and is_list(entry) then
            result[#result + 1], open = offers(what, entry), nil
        else
            if not open then
                open = {}
                result[#result + 1] = open
            end
            open[#open + 1] = offer(what, entry)
        end
    end
    return result
end

local function known_step(what, given)
    local step = check.fields(what, given, known_fields)
    if step.product == nil then check.fail("%s: 'product' is missing", what) end
    if step.from == nil then check.fail("%s: 'from' is missing", what) end
    step.product = molecule(what .. ": product", step.product):smiles "labels"
    local from = step.from
    if type(from) ~= "table" then from = { from } end
    step.from = {}
    for i, entry in ipairs(check.entries(what .. ": from", from)) do
        step.from[i] = molecule(string.format("%s: from %d", what, i), entry):smiles "labels"
    end
    if step.equiv ~= nil then
        local list = type(step.equiv) == "table" and check.entries(what .. ": equiv", step.equiv)
        if not list or #list ~= #step.from then
            check.fail("%s: 'equiv' must be a list of numbers, one for each entry of 'from'", what)
        end
        for _, number in ipairs(list) do
            if type(number) ~= "number" or not (number > 0 and number < math.huge) then
                check.fail("%s: 'equiv' must be numbers above 0", what)
            end
        end
        step.equiv = list
    end
    local yield = step.yield
    if type(yield) == "table" and type(yield[1]) == "number" and type(yield[2]) == "number" then
        yield = (yield[1] + yield[2]) / 2
    end
    if yield ~= nil and not (type(yield) == "number" and yield > 0 and yield <= 100) then
        check.fail("%s: 'yield' must be above 0 and at most 100 per cent", what)
    end
    step.yield = yield
    return step
end

local function known_steps(given)
    local list = {}
    if given == nil then return list end
    if type(given) ~= "table" then check.fail("plan: 'known' must be a list of steps") end
    for i, step in ipairs(check.entries("plan: known", given)) do
        list[i] = known_step(string.format("plan: known step %d", i), step)
    end
    return list
end

local function chosen_transforms(given)
    if given == nil then return nil end
    if type(given) ~= "table" then check.fail("plan: 'transforms' must be a list of transforms") end
    local list = {}
    for i, entry in ipairs(check.entries("plan: transforms", given)) do
        list[i] = core.transform_index(transforms.fetch(entry))
    end
    return list
end

-- A list of molecules; one may stand alone.
local function molecules(what, given)
    local list = {}
    if given == nil then return list end
    if type(given) ~= "table" then given = { given } end
    for i, entry in ipairs(check.entries(what, given)) do
        list[i] = molecule(string.format("%s: entry %d", what, i), entry)
    end
    return list
end

-- Cost models are tables known by this one.
local models = setmetatable({}, { __mode = "k" })

-- The step cost with terms added: { weight, function(step) } each, none of which may lower it.
local function with_terms(what, step, terms)
    if terms == nil then return nil end
    if type(terms) ~= "table" then check.fail("%s: 'terms' must be a list", what) end
    local list = {}
    for i, term in ipairs(check.entries(what .. ": terms", terms)) do
        local weight, f
        if type(term) == "table" then weight, f = term[1], term[2] end
        if type(weight) ~= "number" or not (weight >= 0 and weight < math.huge)
            or type(f) ~= "function" then
            check.fail("%s: term %d: { weight, function(step) } is expected, the weight 0 or more",
                what, i)
        end
        list[i] = { weight, f }
    end
    return function(s)
        local sum = s.cost
        if type(step) == "function" then sum = step(s) end
        for i, term in ipairs(list) do
            local value = term[2](s)
            if type(value) ~= "number" or not (value >= 0 and value < math.huge) then
                check.fail("%s: term %d: must give a number of 0 or more, not %s", what, i,
                    tostring(value))
            end
            sum = sum + term[1] * value
        end
        return sum
    end
end

local function cost_model(mode)
    return function(given)
        local model = check.fields("cost." .. mode, given or {},
            { step = "any", terms = "any", leaf = "code" })
        local step = model.step
        if step ~= nil and type(step) ~= "function"
            and not (type(step) == "number" and step >= 0 and step < math.huge) then
            check.fail("cost.%s: 'step' must be a number of 0 or more, or a function", mode)
        end
        model = { mode = mode, step = step, leaf = model.leaf,
            total = with_terms("cost." .. mode, step, model.terms) }
        models[model] = true
        return model
    end
end

planning.cost = { per_mole = cost_model "per_mole", additive = cost_model "additive" }

local function set_cost(options, cost)
    local step = cost
    if cost == nil then return end
    if type(cost) ~= "function" then
        if type(cost) ~= "table" or not models[cost] then
            check.fail("plan: 'cost' must be cost.per_mole{...}, cost.additive{...} or a function")
        end
        step = cost.step
        options.leaf = cost.leaf
        if cost.mode == "additive" then options.additive = true end
    end
    if type(step) == "function" then
        options.cost = step
    else
        options.step_cost = step
    end
    if type(cost) == "table" and cost.total then options.cost = cost.total end
end

-- As the library numbers them.
local clash_policies = { penalise = 0, allow = 1, refuse = 2 }

local function set_clashes(options)
    local policy = options.clashes or "penalise"
    options.clashes = nil
    options.clash_policy = clash_policies[policy]
    if not options.clash_policy then
        check.fail("plan: 'clashes' must be \"penalise\", \"allow\" or \"refuse\", not '%s'", policy)
    end
end

-- routes = plan { target =, catalogue =, ... }
function planning.plan(given)
    local options = check.fields("plan", given, fields)
    if #check.entries("plan", given) > 0 then
        check.fail("plan: named fields are expected, such as target = ...")
    end
    if options.target == nil then check.fail("plan: 'target' is missing") end
    options.target = molecule("plan: target", options.target)
    options.sources = sources(options.catalogue)
    for name, value in next, check.fields("plan: limits", options.limits or {}, limit_fields) do
        options[name] = value
    end
    options.known = known_steps(options.known)
    options.transforms = chosen_transforms(options.transforms)
    options.at_hand = molecules("plan: at_hand", options.at_hand)
    if options.constraints ~= nil then
        local longest
        options.constraints, longest = constraints.read(options.constraints, options.target)
        options.depth = longest and math.min(longest, options.depth or longest) or options.depth
    end
    if options.trace then check.path("plan: trace", options.trace) end
    if options.quiet == false then options.quiet = nil end
    local strategy = options.strategy
    if strategy == "proof" or strategy == "breadth" then
        options[strategy] = true
    elseif strategy ~= nil and strategy ~= "cheapest" then
        check.fail("plan: 'strategy' must be cheapest, proof or breadth, not '%s'", strategy)
    end
    local cost = options.cost
    options.cost = nil
    set_cost(options, cost)
    set_clashes(options)
    return core.plan(options)
end

-- ---- Searches that are kept ---------------------------------------------------------------

-- A copy of the options that a list's search has.
local function options_of(routes)
    local copy = {}
    for name, value in next, core.search_options(routes) do copy[name] = value end
    return copy
end

local extend_fields = { depth = "count", steps = "count", molecules = "count", seconds = "amount",
    memory = "count", best = "count", threads = "count", quiet = "flag" }

-- rs:extend { molecules = ... }: goes on exploring where the search stopped
function core.routes_methods.extend(routes, given)
    local options = options_of(routes)
    options.seconds, options.trace = nil, nil
    for name, value in next, check.fields("extend", given or {}, extend_fields) do
        options[name] = value
    end
    if options.quiet == false then options.quiet = nil end
    return core.extend(options, routes)
end

local rerank_fields = { catalogue = "any", at_hand = "any", cost = "any", allow = "code",
    keep = "code", rank = "code", without = "any", best = "count", limits = "any",
    diverse = "amount" }

-- rs:rerank { cost = ... }: the routes of what was explored, by other prices, costs or filters
function core.routes_methods.rerank(routes, given)
    local options, what = options_of(routes), {}
    given = check.fields("rerank", given or {}, rerank_fields)
    if given.catalogue ~= nil or given.at_hand ~= nil then
        what.prices = true
        if given.catalogue ~= nil then options.sources = sources(given.catalogue) end
        if given.at_hand ~= nil then options.at_hand = molecules("rerank: at_hand", given.at_hand) end
    end
    if given.cost ~= nil then
        what.costs = true
        if options.leaf or type(given.cost) == "table" and given.cost.leaf then
            what.prices = true
        end
        options.cost, options.step_cost, options.additive, options.leaf = nil, nil, nil, nil
        set_cost(options, given.cost)
    end
    if given.allow then what.steps = true end
    for _, name in ipairs { "allow", "keep", "rank", "best", "diverse" } do
        if given[name] ~= nil then options[name] = given[name] end
    end
    local limits = check.fields("rerank: limits", given.limits or {},
        { depth = "count", steps = "count" })
    for name, value in next, limits do options[name] = value end
    what.without = molecules("rerank: without", given.without)
    return core.rerank(options, routes, what)
end

-- ---- Lists of routes ---------------------------------------------------------------------

-- rs:where(f): those for which f(route) is true
function core.routes_methods.where(routes, f)
    if type(f) ~= "function" then check.fail("where: a function is expected, not a %s", type(f)) end
    local kept = {}
    for _, route in ipairs(routes) do
        if f(route) then kept[#kept + 1] = route end
    end
    return core.pick_routes(kept, routes)
end

-- Sorts a list by `before`, keeping the order of equals; sound whatever `before` answers.
local function merge_sort(list, before)
    if #list < 2 then return list end
    local half = #list // 2
    local a = merge_sort(table.move(list, 1, half, 1, {}), before)
    local b = merge_sort(table.move(list, half + 1, #list, 1, {}), before)
    local i, j, merged = 1, 1, {}
    while i <= #a and j <= #b do
        if before(b[j], a[i]) then
            merged[#merged + 1], j = b[j], j + 1
        else
            merged[#merged + 1], i = a[i], i + 1
        end
    end
    table.move(a, i, #a, #merged + 1, merged)
    return table.move(b, j, #b, #merged + 1, merged)
end

-- What a list may be measured by, the lower the better.
local measures = {}
for _, name in ipairs { "cost", "steps", "longest", "leaves", "runs" } do
    measures[name] = function(route) return route:measure()[name] end
end

function measures.cautions(route)
    local seen, count = {}, 0
    for _, step in ipairs(route:steps()) do
        for _, caution in ipairs(step.cautions) do
            if not seen[caution] then seen[caution], count = true, count + 1 end
        end
    end
    return count
end

-- rs:pareto { "cost", "steps" }: the routes that no other beats in one measure and equals or
-- beats in all; a function(route) is a measure, too
function core.routes_methods.pareto(routes, given)
    local list, points, kept = {}, {}, {}
    for i, measure in ipairs(check.entries("pareto", given or { "cost", "steps", "cautions" })) do
        list[i] = type(measure) == "function" and measure or measures[measure]
        if not list[i] then check.fail("pareto: no measure named '%s'", tostring(measure)) end
    end
    for i, route in ipairs(routes) do
        points[i] = {}
        for k, measure in ipairs(list) do
            points[i][k] = measure(route)
            if type(points[i][k]) ~= "number" then
                check.fail("pareto: measure %d must give a number", k)
            end
        end
    end
    local function beats(a, b)
        local better = false
        for k = 1, #list do
            if a[k] > b[k] then return false end
            better = better or a[k] < b[k]
        end
        return better
    end
    for i, route in ipairs(routes) do
        local beaten = false
        for j = 1, #points do beaten = beaten or beats(points[j], points[i]) end
        if not beaten then kept[#kept + 1] = route end
    end
    return core.pick_routes(kept, routes)
end

-- rs:sort(f): a new list; f(route) gives a number or a string, the lowest first, or f(a, b) says
-- whether a comes before b
function core.routes_methods.sort(routes, f)
    if type(f) ~= "function" then check.fail("sort: a function is expected, not a %s", type(f)) end
    local list = {}
    for i, route in ipairs(routes) do list[i] = route end
    if debug.getinfo(f, "u").nparams == 2 then
        return core.pick_routes(merge_sort(list, f), routes)
    end
    local keys = {}
    for _, route in ipairs(list) do
        local key = f(route)
        if type(key) ~= "number" and type(key) ~= "string" or key ~= key then
            check.fail("sort: the function must give a number or a string, not a %s", type(key))
        end
        if next(keys) and type(select(2, next(keys))) ~= type(key) then
            check.fail("sort: the function gave both numbers and strings")
        end
        keys[route] = key
    end
    return core.pick_routes(merge_sort(list, function(a, b) return keys[a] < keys[b] end), routes)
end

core.offer_type = {
    __tostring = function(offer)
        return string.format("%s  %s  %s", offer.code or "-", offer.name or "-",
            tostring(offer.molecule))
    end,
    __metatable = false,
}

-- A leaf answers for its offer, too.
core.leaf_type = {
    __index = function(leaf, key)
        local offer = rawget(leaf, "offer")
        return offer and offer[key]
    end,
    __tostring = function(leaf) return tostring(leaf.molecule) end,
    __metatable = false,
}

return planning
