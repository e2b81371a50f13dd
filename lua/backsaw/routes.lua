-- Routes as values, beyond what the host gives: files of routes, and two routes side by side.
-- routes_methods also answer at `routes.load` when a script has called a list of its own `routes`.
local core = ...
local check = core.module "check"
local routes = {}

-- rs:save(path)
function core.routes_methods.save(list, path)
    core.save_routes(list, check.path("save", path))
end

-- rs = routes.load(path)
function routes.load(path)
    local list = core.load_routes(check.path("routes.load", path))
    return list
end
core.routes_methods.load = routes.load

-- list = rs:packs(): of the packs that its steps come from, each with name and version
core.routes_methods.packs = core.route_packs

-- ---- Comparing ---------------------------------------------------------------------------

-- What makes a step the same in two routes: its compounds, and for a known step how it is run.
local function step_key(step)
    local from = {}
    for i, precursor in ipairs(step.precursors) do from[i] = tostring(precursor) end
    table.sort(from)
    return table.concat({ tostring(step.product), table.concat(from, "."),
        step.known and table.concat({ "known", step.transform or "", step.conditions or "",
            step.recipe or "" }, "\n") or "" }, " ")
end

local function leaf_key(leaf) return tostring(leaf.molecule) end

-- What both lists have (as the first has it), and what only the one or the other has.
local function split(a, b, key)
    local there, found, result = {}, {}, { shared = {}, { }, { } }
    for _, entry in ipairs(b) do there[key(entry)] = true end
    for _, entry in ipairs(a) do
        local k = key(entry)
        found[k] = true
        table.insert(there[k] and result.shared or result[1], entry)
    end
    for _, entry in ipairs(b) do
        if not found[key(entry)] then table.insert(result[2], entry) end
    end
    return result
end

local measures = { "cost", "steps", "runs", "longest", "leaves", "yield_low", "yield",
    "yield_high" }

local function add_lines(lines, title, entries)
    if #entries == 0 then return end
    lines[#lines + 1] = title
    for _, entry in ipairs(entries) do lines[#lines + 1] = "    " .. tostring(entry) end
end

local function shown(value)
    if math.type(value) == "integer" then return tostring(value) end
    return type(value) == "number" and string.format("%.2f", value) or tostring(value)
end

local comparison = { __metatable = false }

function comparison.__tostring(c)
    local lines = { string.format("%-12s%12s%12s", "", "first", "second") }
    for _, name in ipairs(measures) do
        lines[#lines + 1] = string.format("%-12s%12s%12s", name, shown(c.measures[1][name]),
            shown(c.measures[2][name]))
    end
    add_lines(lines, "steps of both", c.steps.shared)
    add_lines(lines, "steps of the first only", c.steps[1])
    add_lines(lines, "steps of the second only", c.steps[2])
    add_lines(lines, "bought for both", c.leaves.shared)
    add_lines(lines, "bought for the first only", c.leaves[1])
    add_lines(lines, "bought for the second only", c.leaves[2])
    return table.concat(lines, "\n")
end

-- c = r:compare(other): same, steps, leaves, measures
function core.route_methods.compare(a, b)
    if not core.is_route(b) then
        check.fail("compare: a route is expected, not a %s", type(b))
    end
    return setmetatable({
        same = a == b,
        steps = split(a:steps(), b:steps(), step_key),
        leaves = split(a:leaves(), b:leaves(), leaf_key),
        measures = { a:measure(), b:measure() },
    }, comparison)
end

return routes
