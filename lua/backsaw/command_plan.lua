-- backsaw plan SMILES ...: the main job in one line.
local core = ...
local planning = core.module "plan"

local usage = [[
usage: backsaw plan SMILES [-c CATALOGUE]... [-n BEST] [--depth N] [--steps N] [--molecules N]
                    [--seconds S] [--step-cost EUR] [--at-hand SMILES]... [-o FILE.json]
                    [--trace FILE] [CONSTRAINT]... [--quiet]

Plans routes to a molecule and prints a table of them, then the best one as a tree.

  -c CATALOGUE      a catalogue file; several are asked in the order given
  -n BEST           number of routes, 10 without it
  --depth N         steps in line at most
  --steps N         steps of a route at most
  --molecules N     molecules to explore at most
  --seconds S       time to explore
  --step-cost EUR   cost of a step in € a mole, 50 without it
  --at-hand SMILES  a compound that is free
  --trace FILE      write what the search does, as lines of JSON
  -o FILE.json      write the routes into a file as well
  --quiet           no line of progress

Constraints; those marked * may be given again. A word is the beginning of a word in the name,
conditions, recipe, reagents or cautions of a step; atoms are map numbers in the SMILES.

  --avoid WORD           * no step may be like this
  --avoid-compound SMILES * no route may need this compound
  --use WORD             * a step must be like this
  --use-compound SMILES  * a route must need this compound
  --start-from SMILES    * a route must buy this compound; at hand if nobody sells it
  --not-bought SMILES    * do not buy this compound
  --intact SMARTS        * no step may build this
  --keep 1,2             * do not cut bonds between these atoms
  --cut 1,2              * cut this bond
  --first 1,2              cut this bond before any other disconnection
  --protections N          steps that put a protecting group on, at most
  --convergent             two branches must meet

Exit status: 0 routes found, 1 none found or failed, 2 wrong usage.]]

local numbers = { ["-n"] = "best", ["--depth"] = "depth", ["--steps"] = "steps",
    ["--molecules"] = "molecules", ["--seconds"] = "seconds", ["--step-cost"] = "step_cost",
    ["--protections"] = "protections" }
local amounts = { seconds = true, step_cost = true, protections = true } -- 0 is possible

-- Options that fill lists of constraints, and how their value is read.
local function word(value) return value end
local function compound(value) return core.mol(value) end
local function maps(value)
    local list = {}
    for map in string.gmatch(value, "[^,]+") do
        list[#list + 1] = math.tointeger(tonumber(map))
        if not list[#list] then return nil end
    end
    return string.find(value, "^%d+,[%d,]*%d$") and list or nil
end

local constraints = {
    ["--avoid"] = { "avoid", word }, ["--avoid-compound"] = { "avoid", compound },
    ["--use"] = { "use", word }, ["--use-compound"] = { "use", compound },
    ["--start-from"] = { "start_from", compound }, ["--not-bought"] = { "not_bought", compound },
    ["--intact"] = { "intact", word }, ["--keep"] = { "keep", maps }, ["--cut"] = { "cut", maps },
    ["--first"] = { "first", maps },
}

local function wrong(...)
    io.stderr:write("backsaw plan: ", string.format(...), "\n",
        "usage: backsaw plan SMILES [-c CATALOGUE]... (--help tells all options)\n")
    return nil
end

-- Reads the arguments into a table, or says what is wrong and gives nil.
local function read_arguments(arguments)
    local given, i = { catalogues = {}, at_hand = {}, constraints = {} }, 1
    while i <= #arguments do
        local argument = arguments[i]
        local number = numbers[argument]
        if argument == "--help" then return { help = true } end
        if argument == "--quiet" then
            given.quiet = true
        elseif argument == "--convergent" then
            given.constraints.convergent = true
        elseif constraints[argument] then
            local field, read = table.unpack(constraints[argument])
            i = i + 1
            if not arguments[i] then return wrong("%s: a value is expected", argument) end
            local value = read(arguments[i])
            if not value then
                return wrong("%s: map numbers such as 1,2 are expected, not '%s'", argument,
                    arguments[i])
            end
            given.constraints[field] = given.constraints[field] or {}
            table.insert(given.constraints[field], value)
        elseif number or argument == "-c" or argument == "-o" or argument == "--trace"
            or argument == "--at-hand" then
            i = i + 1
            local value = arguments[i]
            if not value then return wrong("%s: a value is expected", argument) end
            if argument == "-c" then
                table.insert(given.catalogues, value)
            elseif argument == "-o" then
                given.output = value
            elseif argument == "--trace" then
                given.trace = value
            elseif argument == "--at-hand" then
                table.insert(given.at_hand, value)
            else
                given[number] = tonumber(value)
                local whole = not amounts[number]
                if not given[number] or given[number] < (whole and 1 or 0)
                    or whole and not math.tointeger(given[number]) then
                    return wrong("%s: a %s is expected, not '%s'", argument,
                        whole and "whole number from 1 on" or "number of 0 or more", value)
                end
            end
        elseif string.sub(argument, 1, 1) == "-" and #argument > 1 then
            return wrong("unknown option '%s'", argument)
        elseif given.target then
            return wrong("one SMILES is expected; '%s' is another", argument)
        else
            given.target = argument
        end
        i = i + 1
    end
    if not given.target then return wrong("a SMILES is expected") end
    given.constraints.protections = math.tointeger(given.protections) or given.protections
    return given
end

local function main(...)
    local given = read_arguments { ... }
    if not given then return 2 end
    if given.help then
        print(usage)
        return 0
    end
    local target = core.mol(given.target)
    local shelf = {}
    for i, path in ipairs(given.catalogues) do shelf[i] = core.open_catalogue(path) end
    if #shelf == 0 then
        io.stderr:write("backsaw: no catalogue given; only compounds without carbon are at hand\n")
    end
    local routes = planning.plan { target = target, catalogue = shelf, at_hand = given.at_hand,
        best = given.best, quiet = given.quiet, trace = given.trace,
        constraints = next(given.constraints) and given.constraints or nil,
        cost = given.step_cost and planning.cost.per_mole { step = given.step_cost } or nil,
        limits = { depth = given.depth, steps = given.steps, molecules = given.molecules,
            seconds = given.seconds } }
    if #routes == 0 then
        io.stderr:write(string.format("backsaw: no route to %s was found%s\n", tostring(target),
            routes.reason and "; " .. routes.reason or ""))
        return 1
    end
    if given.output then routes:save(given.output) end
    print(routes)
    print()
    print(routes[1])
    if routes.reason then io.stderr:write("backsaw: incomplete: ", routes.reason, "\n") end
    return 0
end

return main
