-- Plans published syntheses with each entry's own start compounds as the only catalogue, and counts those whose
-- steps stand among the first 25 routes. With a catalogue that is on the shelf as well, less the target and the
-- intermediates, it is the open setting. Usage: backsaw published.lua DATA LEAST [open=CATALOGUE] [ID...]
--
-- Two steps are the same if they have the same product and the same precursors, each compared once, by canonical
-- structure. Precursors without carbon are left out on both sides, except ammonia, hydroxylamine and hydrazine; the
-- cyanides of sodium, potassium and hydrogen are one; an organomagnesium or organolithium compound counts as its
-- bromide, and the step that makes it is passed over.

local data, least = arg[1], tonumber(arg[2])
local entries = dofile(data)
local chosen, any_chosen, shelf = {}, false, nil
for i = 3, #arg do
    local path = arg[i]:match "^open=(.+)$"
    if path then
        shelf = catalogue.open(path)
    else
        chosen[arg[i]], any_chosen = true, true
    end
end

local cyanides = {}
for _, smiles in ipairs { "[Na+].[C-]#N", "[K+].[C-]#N", "C#N" } do
    cyanides[mol(smiles):smiles()] = true
end
local kept_without_carbon = {}
for _, smiles in ipairs { "N", "NO", "NN" } do
    kept_without_carbon[mol(smiles):smiles()] = true
end
local grignard = rewrite "[C,c:1][Mg]Br>>[C,c:1]Br"
local lithium = rewrite "[C,c:1][Li]>>[C,c:1]Br"

-- The name under which a compound is compared, or nil where it does not count.
local function key(m)
    local smiles = m:smiles()
    if cyanides[smiles] then return "cyanide" end
    if not m:has(pattern "[#6]") and not kept_without_carbon[smiles] then return nil end
    for _, rule in ipairs { grignard, lithium } do
        local outcomes = rule:apply(m)
        if #outcomes > 0 then return outcomes[1][1]:smiles() end
    end
    return smiles
end

local function step_key(product, precursors)
    local target, seen, names = key(product), {}, {}
    for _, m in ipairs(precursors) do
        local name = key(m)
        if name and not seen[name] then
            seen[name] = true
            names[#names + 1] = name
        end
    end
    if #names == 1 and names[1] == target then return nil end -- the halide of its own reagent
    table.sort(names)
    return target .. " <= " .. table.concat(names, " + ")
end

local function same_set(a, b)
    for k in pairs(a) do if not b[k] then return false end end
    for k in pairs(b) do if not a[k] then return false end end
    return true
end

local function published_steps(entry)
    local set = {}
    for _, step in ipairs(entry.steps) do
        local precursors = {}
        for i, smiles in ipairs(step.from) do precursors[i] = mol(smiles) end
        set[step_key(mol(step.product), precursors)] = true
    end
    return set
end

local function route_steps(route)
    local set = {}
    for _, step in ipairs(route:steps()) do
        local k = step_key(step.product, step.precursors)
        if k then set[k] = true end
    end
    return set
end

local function products(entry)
    local list = {}
    for i, step in ipairs(entry.steps) do list[i] = step.product end
    return list
end

local function place(entry)
    local wanted = published_steps(entry)
    local routes = plan {
        target = mol(entry.target),
        catalogue = shelf and { entry.start, shelf } or entry.start,
        constraints = shelf and { not_bought = products(entry) },
        limits = { depth = 8, molecules = 3000 },
        best = 25,
        quiet = true,
    }
    for i = 1, #routes do
        if same_set(route_steps(routes[i]), wanted) then return i, #routes end
    end
    return nil, #routes
end

local found, tried, missing = 0, 0, {}
for _, entry in ipairs(entries) do
    if not any_chosen or chosen[entry.id] then
        local clock = os.clock()
        local at, count = place(entry)
        print(string.format("%-28s %-22s %6.1f s", entry.id, at and "place " .. at .. " of " .. count
            or "not found among " .. count, os.clock() - clock))
        tried = tried + 1
        if at then found = found + 1 else missing[#missing + 1] = entry.id end
    end
end
print(string.format("%d of %d published syntheses found", found, tried))
if found < least then
    io.stderr:write(string.format("expected at least %d; missing: %s\n", least, table.concat(missing, ", ")))
    os.exit(1)
end
