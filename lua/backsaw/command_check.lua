-- backsaw check PACK...: reads packs, runs the self-tests of their transforms, and lints them.
local core = ...
local transforms = core.module "transform"
local groups = core.module "group"
local study = core.module "study"
local lint = core.module "lint"
local json = core.module "json"

local usage = [[
usage: backsaw check [--strict] [--coverage] [--notes] [--json] PACK...

Reads each pack (a file, a folder for all packs in it, or a name on the path) and runs the
self-tests of its transforms: the precursors of every example must be among the steps that the
transform gives for its product, and the transform must give no step for a molecule that it
refuses; the groups and the conditions that it names must be there. Then those of its groups: each
example has as many hits as it says, and non-examples none. What a pack needs is looked for beside
it first.

Warnings tell what is missing in a rule (an example, a refuse, conditions, a recipe, a source),
targets that fit nearly anything, rules that are there twice, and synthons without use. Notes tell
of rules of one pack that undo each other, or make the same example from the same precursors.

  --strict      fail on warnings, too
  --coverage    a table: for each transform its tests, conditions, source
  --notes       print the notes; without it they are counted
  --json        one object with all of it on standard output, and nothing else there

Prints a line for each failure and warning, and a summary. Exit status: 0 all passed, 1 something
failed, 2 wrong usage.]]

local options = { ["--strict"] = "strict", ["--coverage"] = "coverage", ["--notes"] = "notes",
    ["--json"] = "json" }

local function counted(n, word)
    return string.format("%d %s%s", n, word, n == 1 and "" or "s")
end

-- ---- One pack ----------------------------------------------------------------------------------

-- Runs the self-tests: the failures as lines, and how many rules, groups and tests there are.
local function run_tests(pack)
    local result = { transforms = 0, groups = 0, tests = 0, failures = json.list {} }
    local function take(failures, count)
        for _, line in ipairs(failures) do table.insert(result.failures, line) end
        result.tests = result.tests + count
    end
    for _, t in ipairs(transforms.all()) do
        if t.pack == pack.name then
            result.transforms = result.transforms + 1
            take(transforms.test(t))
            take(groups.check_words(t), 0)
        end
    end
    for _, one in ipairs(groups.all()) do
        if one.pack == pack.name then
            result.groups = result.groups + 1
            take(groups.test(one))
        end
    end
    return result
end

local function of_level(findings, level)
    local list = json.list {}
    for _, one in ipairs(findings) do
        if one.level == level then list[#list + 1] = one end
    end
    return list
end

local function check_pack(pack)
    local result = run_tests(pack)
    local findings, coverage = lint.pack(pack)
    result.name, result.version, result.path = pack.name, pack.version, pack.path
    result.warnings, result.notes = of_level(findings, "warning"), of_level(findings, "note")
    result.coverage = json.list(coverage)
    return result
end

-- ---- Text --------------------------------------------------------------------------------------

local function print_findings(findings)
    for _, one in ipairs(findings) do
        print(string.format("%s: %s: %s: %s", one.where, one.level, one.rule, one.text))
    end
end

local function print_coverage(rows)
    local width = 9
    for _, row in ipairs(rows) do width = math.max(width, #row.rule) end
    local line = "%-" .. math.min(width, 60) .. "s  %8s  %8s  %-20s  %s"
    print(string.format(line, "transform", "examples", "refusals", "conditions", "source"))
    for _, row in ipairs(rows) do
        print(string.format(line, row.rule, row.examples, row.refusals, row.conditions or "-",
            row.source and "yes" or "-"))
    end
end

local function print_pack(result, given)
    for _, failure in ipairs(result.failures) do print(failure) end
    print_findings(result.warnings)
    if given.notes then print_findings(result.notes) end
    if given.coverage then print_coverage(result.coverage) end
    local parts = { counted(result.transforms, "transform") }
    if result.groups > 0 then parts[#parts + 1] = counted(result.groups, "group") end
    parts[#parts + 1] = counted(result.tests, "self-test")
    if #result.warnings > 0 then parts[#parts + 1] = counted(#result.warnings, "warning") end
    if #result.notes > 0 then parts[#parts + 1] = counted(#result.notes, "note") end
    parts[#parts + 1] = string.format("%d failed", #result.failures)
    print(string.format("%s: %s", result.name, table.concat(parts, ", ")))
end

-- ---- All packs ---------------------------------------------------------------------------------

-- A folder stands for the packs in it.
local function expand(names)
    local list, problems = {}, {}
    for _, name in ipairs(names) do
        local files = core.folder(name)
        if files then
            table.sort(files)
            local before = #list
            for _, file in ipairs(files) do
                local path = string.gsub(name, "/*$", "") .. "/" .. file
                if study.is_pack((core.pack_text(path))) then
                    list[#list + 1] = path
                else
                    io.stderr:write("backsaw check: ", path, " has no header of a pack; left out\n")
                end
            end
            if #list == before then problems[#problems + 1] = name .. ": no pack in this folder" end
        else
            list[#list + 1] = name
        end
    end
    return list, problems
end

-- The rest of the standard library comes last, for its conditions and for what uses the synthons of
-- these packs. What has the name of a pack that is checked stays out; other conflicts are told.
local function use_library(result, taken)
    local _, library = core.places()
    local files = library and core.folder(library) or {}
    table.sort(files)
    for _, file in ipairs(files) do
        local name = string.match(file, "^(.*)%.lua$")
        local ok, problem = pcall(core.use, library .. "/" .. file)
        if not ok and not taken[name]
            and not string.find(tostring(problem), "is already in use", 1, true) then
            table.insert(result.conflicts, string.format(
                "the standard pack '%s' cannot be used beside these: %s", name, tostring(problem)))
        end
    end
end

local function check_all(names)
    local result, taken, packs, seen = { packs = json.list {}, conflicts = json.list {} }, {}, {}, {}
    local list, problems = expand(names)
    result.unread = json.list(problems)
    for _, name in ipairs(list) do
        local ok, number = pcall(core.use, name)
        if not ok then
            table.insert(result.unread, tostring(number))
        elseif not seen[number] then
            seen[number] = true
            packs[#packs + 1] = study.pack(number)
            taken[packs[#packs].name] = true
        end
    end
    use_library(result, taken)
    result.failed, result.warned = #result.unread, #result.conflicts
    for i, pack in ipairs(packs) do
        local one = check_pack(pack)
        result.packs[i] = one
        result.failed, result.warned = result.failed + #one.failures, result.warned + #one.warnings
    end
    return result
end

local function read_arguments(arguments)
    local given = { names = {} }
    for _, argument in ipairs(arguments) do
        if argument == "--help" then return { help = true } end
        if options[argument] then
            given[options[argument]] = true
        elseif string.sub(argument, 1, 1) == "-" then
            io.stderr:write(string.format("backsaw check: unknown option '%s'\n", argument))
            return nil
        else
            table.insert(given.names, argument)
        end
    end
    if #given.names > 0 then return given end
    io.stderr:write("backsaw check: a pack is expected\n")
    return nil
end

local function main(...)
    local given = read_arguments { ... }
    if not given then
        io.stderr:write("usage: backsaw check [--strict] [--coverage] [--notes] [--json] PACK...\n")
        return 2
    end
    if given.help then
        print(usage)
        return 0
    end
    local result = check_all(given.names)
    result.ok = result.failed == 0 and not (given.strict and result.warned > 0)
    if given.json then
        print(json.text(result))
    else
        for _, line in ipairs(result.unread) do print(line) end
        for _, one in ipairs(result.packs) do print_pack(one, given) end
        for _, line in ipairs(result.conflicts) do print("warning: " .. line) end
    end
    return result.ok and 0 or 1
end

return main
