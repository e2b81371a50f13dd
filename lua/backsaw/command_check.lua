-- backsaw check PACK...: reads packs and runs the self-tests of their transforms.
local core = ...
local transforms = core.module "transform"
local groups = core.module "group"

local usage = [[
usage: backsaw check PACK...

Reads each pack (a file, or a name on the path) and runs the self-tests of its transforms: the
precursors of every example must be among the steps that the transform gives for its product, and
the transform must give no step for a molecule that it refuses; the groups and the conditions that
it names must be there. Then those of its groups: each example has as many hits as it says, and
non-examples none. Prints a line for each failure and a summary. Exit status: 0 all passed, 1 something failed, 2 wrong usage.]]

local function pack_of_number(number)
    for _, pack in ipairs(core.packs()) do
        if pack.number == number then return pack end
    end
end

local function counted(n, word)
    return string.format("%d %s%s", n, word, n == 1 and "" or "s")
end

-- Runs the tests of one pack; returns how many failed.
local function check_pack(pack)
    local rules, kinds, tests, failed = 0, 0, 0, 0
    local function take(failures, count)
        for _, line in ipairs(failures) do print(line) end
        tests, failed = tests + count, failed + #failures
    end
    for _, t in ipairs(transforms.all()) do
        if t.pack == pack.name then
            local failures, count = transforms.test(t)
            rules = rules + 1
            take(failures, count)
            take(groups.check_words(t), 0)
            if count == 0 then
                io.stderr:write(string.format("backsaw: %s: %s: no example\n", t.origin, t.name))
            end
        end
    end
    for _, one in ipairs(groups.all()) do
        if one.pack == pack.name then
            kinds = kinds + 1
            take(groups.test(one))
        end
    end
    print(string.format("%s: %s, %s%s, %d failed", pack.name, counted(rules, "transform"),
        kinds > 0 and counted(kinds, "group") .. ", " or "", counted(tests, "self-test"), failed))
    return failed
end

local function main(...)
    local names, bad = {}, false
    for _, argument in ipairs { ... } do
        if argument == "--help" then
            print(usage)
            return 0
        elseif string.sub(argument, 1, 1) == "-" then
            io.stderr:write(string.format("backsaw check: unknown option '%s'\n", argument))
            bad = true
        else
            names[#names + 1] = argument
        end
    end
    if #names == 0 and not bad then
        io.stderr:write("backsaw check: a pack is expected\n")
        bad = true
    end
    if bad then
        io.stderr:write("usage: backsaw check PACK...\n")
        return 2
    end
    local failed = 0
    for _, name in ipairs(names) do
        local ok, number = pcall(core.use, name)
        if ok then
            failed = failed + check_pack(pack_of_number(number))
        else
            print(tostring(number))
            failed = failed + 1
        end
    end
    return failed == 0 and 0 or 1
end

return main
