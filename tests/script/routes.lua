-- Routes as values: files, merging, comparing, running steps again. What the lists hold follows
-- from the known steps by hand, as in route.lua.
local known = {
    { product = "CCN", from = { "CCBr", "N" }, equiv = { 1, 3 }, yield = 50, cost = 10, name = "amination" },
    { product = "CCN", from = { "CC#N", "[H][H]" }, yield = 80, cost = 10, name = "hydrogenation" },
    { product = "CCBr", from = { "CCO", "Br" }, yield = 80, cost = 4, name = "bromination" },
}
local shelf = { "CCO", { "CCBr", per_mole = 7 }, { "CC#N", per_mole = 100 } }
local list = plan { target = mol "CCN", catalogue = shelf, known = known, transforms = {} }
print(#list) --> 3

-- files
local path = os.tmpname()
list:save(path)
local loaded = routes.load(path)
print(#loaded, loaded.complete, loaded.target == list.target, #loaded:gaps() == #list:gaps()) --> 3	true	true	true
for i, route in ipairs(list) do
    if route ~= loaded[i] or route.cost ~= loaded[i].cost or tostring(route) ~= tostring(loaded[i]) then
        print("route", i)
    end
end
print(tostring(loaded) == tostring(list), loaded.explored.molecules == list.explored.molecules) --> true	true
local function content(name)
    local file = assert(io.open(name, "rb"))
    local text = file:read "a"
    file:close()
    return text
end
local first = content(path)
loaded:save(path)
print(content(path) == first, first:find('"version": 1,', 1, true) ~= nil) --> true	true
print(list.load(path)[1] == list[1]) --> true
print(list[1]:json():sub(1, 1), list[1]:json():find('"transform": "amination"', 1, true) ~= nil) --> {	true

-- what cannot be read, and where not to write
local file = assert(io.open(path, "w"))
file:write('{ "format": "backsaw routes",\n"version": 1, "routes": [ { "mode": "per mole", "molecules": [] } ] }')
file:close()
print((fails(routes.load, path):gsub("^.*: line", "line"))) --> line 2: routes[1].steps: is missing
os.remove(path)
print(fails(routes.load, path):find "No such file" ~= nil or fails(routes.load, path)) --> true
print(fails(routes.load, 3)) --> routes.load: a file name is expected, not a number
print(fails(list.save, list, "no/such/folder/x.json")) --> no/such/folder/x.json: cannot be written: No such file or directory

-- merging
local cheap = list:where(function(r) return r.cost < 40 end)
local dear = list:where(function(r) return r.cost >= 34 end)
local merged = dear:merge(cheap)
print(#cheap, #dear, #merged, merged[1] == list[1], merged[3] == list[3]) --> 2	2	3	true	true
print(fails(list.merge, list, plan { target = "CCO", transforms = {} })) --> merge: the routes are for different targets, CCN and CCO
print(fails(list.merge, list, 3)) --> argument 2: list of routes expected, got number

-- comparing: amination of bought or of made bromide
local c = list[1]:compare(list[2])
print(c.same, #c.steps.shared, #c.steps[1], #c.steps[2]) --> false	1	1	0
print(c.steps[1][1].transform, c.measures[1].steps, c.measures[2].steps) --> bromination	2	1
print(#c.leaves.shared, #c.leaves[1], #c.leaves[2], c.leaves[2][1].molecule == mol "CCBr") --> 1	2	1	true
print(list[1]:compare(list[1]).same, tostring(c):find "steps of the first only" ~= nil) --> true	true
print(fails(list[1].compare, list[1], 5)) --> compare: a route is expected, not a number

-- steps of rules are run again
interconversion "test reduction of a nitrile" { target = "[CX4;H2:1]-[NX3;H2:2]", from = "[C:1]#[N:2]" }
local ruled = plan { target = "NCc1ccccc1", catalogue = { "N#Cc1ccccc1" }, limits = { depth = 1 },
    transforms = { "test reduction of a nitrile" } }
print(ruled[1]:verify(), list[1]:verify()) --> true	true
ruled:save(path)
print(routes.load(path)[1]:steps()[1].checked) --> true
interconversion "test reduction of a nitrile" { target = "[CX4;H3:1]-[NX3;H2:2]", from = "[C:1]#[N:2]" }
print(ruled[1]:verify()) --> false	1	'test reduction of a nitrile' does not give this step
loaded = routes.load(path)
print(#loaded, loaded[1]:steps()[1].checked, loaded[1]:measure().checked) --> 1	false	false
os.remove(path)
