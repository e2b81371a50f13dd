-- Constraints, each alone and in pairs, against all routes of small graphs, which are enumerated
-- here one by one. The graphs are random: a chain of units that differ, cut into shorter chains,
-- each chain in two forms; steps go by names and conditions that constraints ask for.
local units = { "C(F)", "N(C)", "C(Cl)", "[SiH](C)" }
local attach = { "", "I" } -- what stands in for a form, at the end of the chain

local state = 20260101
local function random(n)
    state = (state * 1103515245 + 12345) % 2147483648
    return state // 65536 % n + 1
end

-- The chain from unit i to unit j in form v; with map numbers if `labels`.
local function chain(i, j, v, labels)
    local text = {}
    for k = i, j do
        local atom, rest = units[k]:match "^(%[?%a+%d?%]?)(.*)$"
        if units[k]:sub(1, 1) == "[" then atom, rest = "[SiH]", units[k]:sub(6) end
        if labels then
            local bare = atom:gsub("[%[%]]", ""):gsub("H.*", "")
            -- hydrogens follow from the valence: one on carbon at the ends of a chain, and so on
            local bonds = (k > i and 1 or 0) + (k < j and 1 or 0) + (k == j and v == 2 and 1 or 0) + 1
            local valence = bare == "N" and 3 or 4
            local h = valence - bonds
            atom = string.format("[%s%s:%d]", bare, h > 1 and "H" .. h or h == 1 and "H" or "", k)
        elseif atom == "[SiH]" then
            local bonds = (k > i and 1 or 0) + (k < j and 1 or 0) + (k == j and v == 2 and 1 or 0) + 1
            local h = 4 - bonds
            atom = string.format("[Si%s]", h > 1 and "H" .. h or h == 1 and "H" or "")
        end
        text[#text + 1] = atom .. rest
    end
    return table.concat(text) .. attach[v]
end

local function key(i, j, v) return i * 100 + j * 10 + v end

local names = { "oxidation", "reduction", "coupling", "boc-protection", "Boc removal" }
local settings = { "dry base", "acid", "heat" }

-- A random graph: prices by key, steps by the key of their product, each with what it cuts.
local function make_graph(n)
    local graph = { n = n, price = {}, steps = {}, known = {}, offers = {} }
    local function add(i, j, v, cut, from)
        local step = { product = key(i, j, v), i = i, j = j, cut = cut, from = {}, equiv = {},
            cost = random(50), yield = 40 + random(50), name = names[random(#names)],
            conditions = settings[random(#settings)] }
        local given = { product = chain(i, j, v, true), from = {}, equiv = step.equiv,
            cost = step.cost, yield = step.yield, name = step.name, conditions = step.conditions }
        for k, part in ipairs(from) do
            step.from[k] = key(table.unpack(part))
            step.equiv[k] = 1 + random(3) / 2
            given.from[k] = chain(part[1], part[2], part[3], true)
        end
        graph.steps[step.product] = graph.steps[step.product] or {}
        table.insert(graph.steps[step.product], step)
        graph.known[#graph.known + 1] = given
    end
    for i = 1, n do
        for j = i, n do
            for v = 1, 2 do
                local whole = i == 1 and j == n
                if random(2) == 1 and not (whole and v == 1) or i == j and v == 1 then
                    graph.price[key(i, j, v)] = random(200)
                    graph.offers[#graph.offers + 1] =
                        { chain(i, j, v), per_mole = graph.price[key(i, j, v)] }
                end
                for cut = i, j - 1 do
                    if random(5) <= 3 then
                        add(i, j, v, cut, { { i, cut, random(2) }, { cut + 1, j, random(2) } })
                    end
                end
                if random(3) == 1 then add(i, j, v, nil, { { i, j, 3 - v } }) end
                if random(6) == 1 then add(i, j, v, nil, { { i, j, 3 - v } }) end -- another way to run it
            end
        end
    end
    graph.target = key(1, n, 1)
    return graph
end

-- All routes: one decision (a step, or buying) for each compound that is needed, no circle.
local function all_routes(graph, prices)
    local routes = {}
    local function finish(choice)
        local cost, line, open, used, bought = {}, {}, {}, {}, {}
        local function visit(compound)
            if cost[compound] then return true end
            if open[compound] then return false end
            open[compound] = true
            local step = choice[compound]
            if step == "buy" then
                cost[compound], line[compound] = prices[compound], 0
                bought[compound] = true
            else
                local sum, longest = step.cost, 0
                for k, part in ipairs(step.from) do
                    if not visit(part) then return false end
                    sum = sum + step.equiv[k] * cost[part]
                    longest = math.max(longest, line[part])
                end
                cost[compound], line[compound] = sum / (step.yield / 100), longest + 1
                used[#used + 1] = step -- those before first
            end
            open[compound] = nil
            return true
        end
        if visit(graph.target) then
            routes[#routes + 1] = { steps = used, bought = bought, cost = cost[graph.target],
                longest = line[graph.target] }
        end
    end
    local function decide(pending, at, choice)
        local compound = pending[at]
        if not compound then return finish(choice) end
        if choice[compound] then return decide(pending, at + 1, choice) end
        if prices[compound] then
            choice[compound] = "buy"
            decide(pending, at + 1, choice)
        end
        for _, step in ipairs(graph.steps[compound] or {}) do
            local wider = table.move(pending, 1, #pending, 1, {})
            for _, part in ipairs(step.from) do wider[#wider + 1] = part end
            choice[compound] = step
            decide(wider, at + 1, choice)
        end
        choice[compound] = nil
    end
    decide({ graph.target }, 1, {})
    return routes
end

local function count(route, f)
    local n = 0
    for _, step in ipairs(route.steps) do n = n + (f(step) and 1 or 0) end
    return n
end

local function spans(step, a) return step.i <= a and step.j > a end

local function any_bought(route, f)
    for compound in pairs(route.bought) do
        if f(compound // 100, compound // 10 % 10, compound % 10) then return true end
    end
    return false
end

-- Each constraint: what plan{} is told, and what it means for a route of the list.
local n = #units
local cases = {
    { "avoid = word", { avoid = { "oxid" } },
        function(r) return count(r, function(s) return s.name == "oxidation" end) == 0 end },
    { "avoid = compound", { avoid = { mol(chain(1, 2, 1)) } }, function(r)
        return count(r, function(s) return s.from[1] == key(1, 2, 1) or s.from[2] == key(1, 2, 1) end) == 0
    end },
    { "use = word", { use = { "base" } }, -- not at the beginning of the text
        function(r) return count(r, function(s) return s.conditions == "dry base" end) > 0 end },
    { "use = pattern", { use = { pattern "[Si]I" } }, function(r)
        return count(r, function(s)
            for _, part in ipairs(s.from) do
                if part // 10 % 10 == n and part % 10 == 2 then return true end
            end
        end) > 0
    end },
    { "at_most", { at_most = { 1, "coupling" } },
        function(r) return count(r, function(s) return s.name == "coupling" end) <= 1 end },
    { "not_bought", { not_bought = { chain(2, 2, 1) } },
        function(r) return not r.bought[key(2, 2, 1)] end },
    { "start_from", { start_from = { chain(3, n, 2) } },
        function(r) return r.bought[key(3, n, 2)] end, key(3, n, 2) },
    { "intact", { intact = { "N-C-Cl" } }, function(r) -- units 2 and 3 stay together
        return count(r, function(s) return s.cut == 2 end) == 0
    end },
    { "keep", { keep = { 1, 2 } }, function(r)
        return count(r, function(s) return s.cut == 1 end) == 0
    end },
    { "cut", { cut = { 3, 4 } }, function(r)
        return not any_bought(r, function(i, j) return i <= 3 and j >= 4 end)
    end },
    { "first", { first = { 2, 3 } }, function(r)
        return count(r, function(s) return s.cut and spans(s, 2) and s.cut ~= 2 end) == 0
            and not any_bought(r, function(i, j) return i <= 2 and j >= 3 end)
    end },
    { "protections", { protections = 1 },
        function(r) return count(r, function(s) return s.name == "boc-protection" end) <= 1 end },
    { "unprotect", { unprotect = true }, function(r)
        local on = {}
        for _, step in ipairs(r.steps) do
            local sum = 0
            for _, part in ipairs(step.from) do sum = sum + (on[part] or 0) end
            if step.name == "boc-protection" then sum = sum + 1 end
            if step.name == "Boc removal" then sum = math.max(0, sum - 1) end
            on[step.product] = sum
        end
        -- groups that the target keeps; a route that puts none on has none to keep
        return on[key(1, n, 1)] == 0 or on[key(1, n, 1)] == nil
    end },
    { "longest", { longest = 3 }, function(r) return r.longest <= 3 end },
    { "convergent", { convergent = true }, function(r) return #r.steps > r.longest end },
}

local function costs(list)
    local numbers = {}
    for i, route in ipairs(list) do numbers[i] = route.cost end
    table.sort(numbers)
    return numbers
end

local function same(a, b)
    if #a ~= #b then return false end
    for i = 1, #a do
        if math.abs(a[i] - b[i]) > 1e-9 * b[i] then return false end
    end
    return true
end

local asked, answered, left_out, largest, first_wrong = 0, 0, 0, 0, nil
local bites = {}

local function try(graph, number, chosen)
    local constraints, prices, tests, label = {}, {}, {}, {}
    for k, v in pairs(graph.price) do prices[k] = v end
    for _, case in ipairs(chosen) do
        for field, value in pairs(case[2]) do
            if constraints[field] then return end -- two of a field make one list; tried below
            constraints[field] = value
        end
        tests[#tests + 1], label[#label + 1] = case[3], case[1]
        if case[4] and not prices[case[4]] then prices[case[4]] = 0 end
    end
    local all, wanted = all_routes(graph, prices), {}
    for _, route in ipairs(all) do
        local good = true
        for _, test in ipairs(tests) do good = good and test(route) end
        if good then wanted[#wanted + 1] = route end
    end
    local found = plan { target = chain(1, graph.n, 1, true), catalogue = graph.offers,
        known = graph.known, transforms = {}, constraints = constraints, best = 2000,
        limits = { depth = 40 }, quiet = true }
    local numbers = {}
    for i, route in ipairs(found) do numbers[i] = route.cost end
    asked, answered = asked + 1, answered + #numbers
    left_out, largest = left_out + #all - #wanted, math.max(largest, #all)
    if #chosen == 1 and #wanted < #all and #wanted > 0 then bites[chosen[1][1]] = true end
    if not found.complete or not same(numbers, costs(wanted)) then
        first_wrong = first_wrong or string.format("graph %d, %s: %d routes instead of %d of %d, %s", number,
            table.concat(label, " and "), #numbers, #wanted, #all, tostring(found.reason))
    end
end

local graphs = tonumber(os.getenv "BACKSAW_GRAPHS") or 5
for number = 1, graphs do
    local graph = make_graph(n)
    try(graph, number, {})
    for i, case in ipairs(cases) do
        try(graph, number, { case })
        for k = i + 1, #cases do try(graph, number, { case, cases[k] }) end
    end
end
print(first_wrong or "all routes") --> all routes
print(asked > 100 and answered > 1000 and left_out > 1000) --> true
for _, case in ipairs(cases) do
    if not bites[case[1]] then print("no graph on which this matters: " .. case[1]) end
end

-- what is refused
local function refused(constraints, target)
    return fails(plan, { target = target or "[CH3:1][CH2:2][OH:3]", constraints = constraints })
end
print(refused { 5 }) --> plan: constraints: named fields are expected, such as avoid = { ... }
print(refused { avoids = 5 }) --> plan: constraints: unknown field 'avoids'; did you mean 'avoid'?
print(refused { avoid = 5 }) --> plan: constraints: avoid: a word, a molecule, a pattern or a transform is expected, not a number
print(refused { avoid = "" }) --> plan: constraints: avoid: a word, a molecule, a pattern or a transform is expected, not an empty string
print(refused { at_most = { "x", "ozone" } }) --> plan: constraints: at_most: a whole number of 0 or more is expected
print(refused { at_most = 3 }) --> plan: constraints: at_most: a number and what it is for are expected, such as { 1, "ozone" }
print(refused { start_from = 3 }) --> plan: constraints: start_from: a molecule or SMILES is expected, not a number
print(refused { keep = { 1, 4 } }) --> plan: constraints: keep: no atom of the target has the map number 4
print(refused { keep = { 1, 3 } }) --> plan: constraints: keep: these atoms are not bonded
print(refused { cut = { 1, 2, 3 } }) --> plan: constraints: cut: map numbers such as { 1, 2 } are expected
print(refused({ cut = { 1, 2 } }, "[CH3:1][CH2:1]O")) --> plan: target: two atoms have the map number 1
print(refused { protections = -1 }) --> plan: constraints: protections: a whole number of 0 or more is expected
print(refused { longest = 0 }) --> plan: constraints: 'longest' must be a whole number from 1 on, not 0
