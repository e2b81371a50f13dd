-- Rules whose functions fail in a search: they fall out of it, the others go on, and threads change nothing.
-- The chemistry (an ether from a phenol and a halide, an ester from an acid and an alcohol) is common
-- practice, no source; which rule falls out, and with what words, follows from docs/language.md.
use "quay"

local function read(path)
    local file = assert(io.open(path, "rb"))
    local text = file:read "a"
    file:close()
    return text
end

local pack_path = os.tmpname()
os.remove(pack_path)
pack_path = pack_path .. ".lua"
local file = assert(io.open(pack_path, "w"))
file:write [[
pack { name = "faulty", version = "1" }
local ether = { target = "[CH2:1][O:2][c:3]", from = "[C:1]Cl.[O:2][c:3]" }
local function rule(name, more)
    local t = { target = ether.target, from = ether.from }
    for k, v in pairs(more) do t[k] = v end
    interconversion(name)(t)
end
rule("try endless", { when = function() while true do end end })
rule("try raising", { when = function() error "this went wrong" end })
rule("try table", { when = function() return {} end })
rule("try nan", { prefer = function() return 0 / 0 end })
rule("try full", { when = function() local t = 'x' while true do t = t .. t end end })
-- its answers tell whether a state was made anew since
local turns = 0
interconversion "try alternating" { target = "[#6:1][NX3:2]", from = "[*:1]F.[N:2]", when = function()
    turns = turns + 1
    return turns <= 6
end }
-- out in the middle of a search: of what comes after it in the same batch nothing is left
interconversion "try picky" { target = "[CX4:1][NX3:2]", from = "[C:1]Br.[N:2]", when = function(site)
    if site.molecule:count "Cl" == 0 then error("picky: no chlorine in " .. tostring(site.molecule)) end
    return true
end }
-- an answer that depends on what was asked before
local calls = 0
interconversion "try counting" { target = "[CX4:1][NX3:2]", from = "[C:1]I.[N:2]", when = function()
    calls = calls + 1
    if calls == 4 then error "asked four times" end
    return calls % 2 == 1
end }
-- three that fail at one amine each
for name, bad in pairs { ["try butyl"] = "CCCCN", ["try pentyl"] = "CCCCCN", ["try hexyl"] = "CCCCCCN" } do
    interconversion(name) { target = "[CH2:1][NH2:2]", from = "[C:1]Br.[N:2]", when = function(site)
        return site.molecule ~= mol(bad) or error "not this one"
    end }
end
]]
file:close()
use(pack_path)
local function clean(text) return (text:gsub(pack_path:gsub("%p", "%%%0"), "PACK")) end

local shelf = { "Oc1ccccc1", "CCBr", "CCO", "CC(=O)O", "CC(=O)Cl", "Nc1ccccc1", "O=C(O)c1ccccc1", "NCCN1CCOCC1",
    "O=C(O)c1ccc(Cl)cc1", "O=C(Cl)c1ccc(Cl)cc1", "C1COCCN1", "NCCBr", "OCCN", "N#Cc1ccc(Cl)cc1" }

-- the good rule still gives its route, and each bad one has its line
local found = plan { target = "CCOc1ccccc1", catalogue = shelf, quiet = true,
    transforms = { "quay ether", "try endless", "try raising", "try table", "try nan" } }
print(#found, found.complete, tostring(found[1]:steps()[1].transform)) --> 1	true	quay ether
for _, line in ipairs(found.warnings) do print(clean(line)) end
--> transform 'try endless' is left out of the rest of the search: PACK:8: the limit of instructions for a pack is reached
--> transform 'try raising' is left out of the rest of the search: PACK:9: this went wrong
--> transform 'try table' is left out of the rest of the search: 'when' must give true or false, not a table
--> transform 'try nan' is left out of the rest of the search: 'prefer' must give a number, not NaN
print(clean(tostring(found)):match "warning: transform 'try raising'[^\n]*")
--> warning: transform 'try raising' is left out of the rest of the search: PACK:9: this went wrong
for _, t in ipairs(found:transforms()) do print(t.transform, t.found, t.used, t.fault and clean(t.fault)) end
--> quay ether	1	1	nil
--> try endless	0	0	PACK:8: the limit of instructions for a pack is reached
--> try raising	0	0	PACK:9: this went wrong
--> try table	0	0	'when' must give true or false, not a table
--> try nan	0	0	'prefer' must give a number, not NaN

-- lists made from it say the same, and so does a file; going on does not ask again
local saved = os.tmpname()
found:save(saved)
print(#found:where(function() return false end).warnings, #routes.load(saved).warnings) --> 4	4
os.remove(saved)
print(#found:extend { molecules = 100 }.warnings, #found:merge(found).warnings) --> 4	4
print(#plan { target = "CCOc1ccccc1", catalogue = shelf, transforms = { "quay ether" } }.warnings) --> 0

-- memory is a limit like the others
local full = plan { target = "CCOc1ccccc1", catalogue = shelf, quiet = true, threads = 1,
    transforms = { "quay ether", "try full" } }
print(#full, clean(full.warnings[1]):match ": (.*)") --> 1	a string of more than 256 KiB in a pack

-- Three amines are expanded in one batch, and each of three rules fails at another of them: it keeps the steps of
-- those before, and none of those behind, so that of the three one keeps 0, one 1 and one 2.
for threads = 1, 4, 3 do
    local three = plan { target = "O=C(NCCCC)c1cc(C(=O)NCCCCC)cc(C(=O)NCCCCCC)c1", catalogue = shelf, quiet = true,
        transforms = { "try butyl", "try pentyl", "try hexyl" }, threads = threads,
        known = { { product = "O=C(NCCCC)c1cc(C(=O)NCCCCC)cc(C(=O)NCCCCCC)c1",
            from = { "CCCCN", "CCCCCN", "CCCCCCN", "O=C(Cl)c1cc(C(=O)Cl)cc(C(=O)Cl)c1" } } } }
    local counts = {}
    for i, t in ipairs(three:transforms()) do counts[i] = t.found end
    table.sort(counts)
    print(#three.warnings, table.concat(counts, " "))
end
--> 3	0 1 2
--> 3	0 1 2

-- called directly, a function that fails raises
print((fails(transform("try raising").back, transform "try raising", mol "CCOc1ccccc1"):gsub("^.*:%d+: ", ""))) --> this went wrong

-- the same bytes with any number of threads: routes, warnings, and each step that was found
local function search(threads)
    local trace = os.tmpname()
    local list = plan { target = "O=C(NCCN1CCOCC1)c1ccc(Cl)cc1", catalogue = shelf, threads = threads, best = 20,
        quiet = true, trace = trace, limits = { depth = 4, molecules = 250 } }
    local texts = { tostring(list), read(trace):gsub('"seconds":[^,}]*', "") }
    os.remove(trace)
    for i, route in ipairs(list) do texts[#texts + 1] = tostring(route) end
    for i, t in ipairs(list:transforms()) do
        texts[#texts + 1] = table.concat({ t.transform, t.tried, t.found, t.refused, t.used, t.fault }, " ")
    end
    return table.concat(texts, "\n"), list
end
local one, list = search(1)
print(one == search(2), one == search(4), one == search(1)) --> true	true	true
print(#list > 2, one:match "warning: transform 'try picky'" ~= nil, one:match "warning: transform 'try counting'" ~= nil)
--> true	true	true
local picky
for _, t in ipairs(list:transforms()) do if t.transform == "try picky" then picky = t end end
print(picky.found > 0, picky.fault:match "picky: no chlorine" ~= nil) --> true	true
os.remove(pack_path)
