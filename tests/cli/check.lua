-- backsaw check: lint, coverage, JSON, folders, other versions of standard packs. What is said of a
-- pack is compared with what the pack was written to have: facts of the texts below, no source.
local program = dofile(os.getenv "BACKSAW_CLI" .. "/program.lua")
local run, expect, file = program.run, program.expect, program.file

local function check(arguments, status, finds, lacks)
    local result = run(arguments)
    expect("status " .. status, result, result.status == status)
    for _, text in ipairs(finds or {}) do expect(text, result, result.out:find(text, 1, true)) end
    for _, text in ipairs(lacks or {}) do expect("without " .. text, result, not result.out:find(text, 1, true)) end
    return result
end

local clean = [[
interconversion "quay hydration" { target = "[CX4;H0:1]([OX2H:3])[CX4;H3:2]", from = "[C:1]=[C:2].[O:3]",
    conditions = "quay acid", recipe = "dilute H2SO4", source = "invented",
    example { "CC(C)(C)O", from = { "CC(C)=C", "O" } }, refuse { "CCO" } }
]]
local class = 'conditions "quay acid" { reagents = "H2SO4" }\n'

-- nothing to say
local path = file('pack { name = "calm" }\n' .. class .. clean)
check({ "--bare", "check", "--strict", "--notes", path }, 0, { "calm: 1 transform, 2 self-tests, 0 failed" }, { "warning" })
os.remove(path)

-- everything missing, a wide target, a synthon without use: warnings, fatal only with --strict
path = file [[
pack { name = "poor" }
synthon "poor cyanide" { kind = "donor", equivalents = { "[Na]" } }
interconversion "poor rule" { target = "[#6:1]", from = "[#6:1]O" }
]]
local all = { "poor rule: no example", "poor rule: no refuse", "poor rule: no class of conditions",
    "poor rule: no recipe", "poor rule: no source", "poor rule: the target fits 20 of 20 common compounds",
    "poor cyanide: no disconnection in use has this synthon", "7 warnings, 0 failed" }
check({ "--bare", "check", path }, 0, all)
check({ "--bare", "check", "--strict", path }, 1, all)
check({ "--bare", "check", "--coverage", path }, 0, { "transform", "poor rule", "       0" })
os.remove(path)

-- twice the same but for map numbers; told apart by a function; swapped; overlapping
path = file([[
pack { name = "twins" }
interconversion "one" { target = "[CX3:1]=[OX1:2]", from = "[C:1]([OX2H:2])",
    example { "CC(C)=O", from = { "CC(C)O" } } }
interconversion "two" { target = "[CX3:5]=[OX1:7]", from = "[C:5]([OX2H:7])" }
interconversion "three" { target = "[CX3:1]=[OX1:2]", from = "[C:1]([OX2H:2])", when = function() return true end }
interconversion "back" { target = "[C:1]([OX2H:2])", from = "[CX3:1]=[OX1:2]" }
]])
check({ "--bare", "check", "--notes", path }, 0, { "warning: two: the same target and precursors as 'one'",
    "note: three: the same target and precursors as 'one'", "note: back: the inverse of",
    "note: one: 'two' makes its example CC(C)=O from the same precursors" }, { "warning: three: the same", "warning: one: the same" })
check({ "--bare", "check", path }, 0, { "notes, 0 failed" }, { "note: back" })
os.remove(path)

-- a synthon in use is not complained of
check({ "--bare", "check", "quay-base", "quay" }, 0, nil, { "no disconnection" })

-- a field that nobody knows
path = file 'pack { name = "typo" }\ninterconversion "x" { target = "[C:1]O", from = "[C:1]Cl", recepe = "" }\n'
check({ "--bare", "check", path }, 1, { "unknown field 'recepe'; did you mean 'recipe'?" })
os.remove(path)

-- a folder, and one without packs
local folder = os.tmpname()
os.remove(folder)
assert(os.execute("mkdir '" .. folder .. "'"))
check({ "--bare", "check", folder }, 1, { "no pack in this folder" })
local function put(name, text)
    local f = assert(io.open(folder .. "/" .. name, "w"))
    f:write(text)
    f:close()
end
put("b.lua", 'pack { name = "b", needs = { "a" } }\n' .. clean)
put("a.lua", 'pack { name = "a", version = "2.0.0" }\n' .. class)
put("notes.txt", "no pack")
put("script.lua", "print(plan)")
check({ "--bare", "check", "--strict", folder }, 0, { "a: 0 transforms", "b: 1 transform, 2 self-tests, 0 failed" })
check({ "--bare", "check", folder .. "/b.lua" }, 0, { "b: 1 transform" }, { "a: 0" }) -- needs lie beside it

-- JSON that a reader of the standard takes; quotes and line ends in names come back
put("a.lua", 'pack { name = "a", version = "2.0.0" }\n' .. class)
put("b.lua", 'pack { name = "b", needs = { "a" } }\n' .. clean:gsub("quay hydration", 'a \\"q\\" \\\\ µ'))
local result = run { "--bare", "check", "--json", folder }
local json = folder .. "/out.json"
put("out.json", result.out)
expect("JSON", result, os.execute(string.format("cmake -DFILE='%s' -P '%s/json.cmake'", json,
    os.getenv "BACKSAW_CLI")))
os.execute("rm -r '" .. folder .. "'")

-- another version of a standard pack stands for it; a rule with the name of a standard rule is told
path = file([[
pack { name = "alcohols", version = "9.0.0" }
]] .. class .. clean)
check({ "check", path }, 0, { "alcohols: 1 transform" }, { "cannot be used beside" })
os.remove(path)
path = file([[
pack { name = "rival", version = "9.0.0" }
]] .. clean:gsub("quay hydration", "suzuki-biaryl"))
check({ "check", path }, 1, { "no class is called 'quay acid'", "the standard pack 'cross-coupling' cannot be used beside these" })
os.remove(path)

program.finish()
