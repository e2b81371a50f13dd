-- Lists of routes, routes, their steps and leaves.
local known = {
    { product = "CCN", from = { "CCBr", "N" }, equiv = { 1, 3 }, yield = 50, cost = 10, name = "amination" },
    { product = "CCBr", from = { "CCO", "Br" }, yield = 80, cost = 4, name = "bromination" },
}
local routes = plan { target = mol "CCN", catalogue = { "CCO", { "CCBr", per_mole = 7 } }, known = known,
    transforms = {} }
print(#routes, routes[0], routes[3], routes.none) --> 2	nil	nil	nil
print(routes[1] == routes[1], routes[1] == routes[2], rawequal(routes[1], routes[1])) --> true	false	true
local n = 0
for _, route in ipairs(routes) do n = n + route:measure().steps end
print(n) --> 3

-- a table of one line a route
local lines = 0
for _ in tostring(routes):gmatch "[^\n]+" do lines = lines + 1 end
print(lines >= 2, tostring(routes[1]):find "amination" ~= nil) --> true	true

-- steps in bench order
local long = routes:where(function(r) return r:measure().steps == 2 end)[1]
local steps = long:steps()
print(#steps, steps[1].transform, steps[2].transform) --> 2	bromination	amination
print(steps[1].product == mol "CCBr", steps[2].product == mol "CCN", steps[2].known, steps[2].cost) --> true	true	true	10.0
local hydrogens = {}
for i, m in ipairs(steps[2].precursors) do hydrogens[m:formula()] = steps[2].equivalents[i] end
print(hydrogens.H3N, hydrogens.C2H5Br, #steps[2].rivals, steps[2].yield and steps[2].yield[1]) --> 3	1	0	50
print(steps[1]:uses "brom", steps[1]:uses(mol "OCC"), steps[1]:uses(mol "CO")) --> true	true	false

-- leaves
local leaves = long:leaves()
table.sort(leaves, function(a, b) return tostring(a) < tostring(b) end)
local names = {}
for i, leaf in ipairs(leaves) do names[i] = leaf.molecule:formula() end
table.sort(names)
print(table.concat(names, " "), leaves[1].offer) --> BrH C2H6O H3N	nil

-- where and sort make new lists
print(#routes:where(function(r) return r.cost > 1e6 end), #routes) --> 0	2
local sorted = routes:sort(function(r) return -r.cost end)
print(sorted[1].cost >= sorted[2].cost, #sorted, sorted.complete) --> true	2	true
sorted = routes:sort(function(a, b) return a.cost > b.cost end)
print(sorted[1].cost >= sorted[2].cost) --> true
print(fails(routes.sort, routes, function() return {} end)) --> sort: the function must give a number or a string, not a table
print(fails(routes.where, routes)) --> where: a function is expected, not a nil
print(routes.target == mol "CCN", routes[1].target == mol "CCN", routes.explored.molecules > 0) --> true	true	true

-- a route outlives its list
local kept = routes[1]
routes, sorted = nil, nil
collectgarbage()
print(kept.cost > 0) --> true

-- gaps: what nobody sells
local none = plan { target = "CCN", known = known, transforms = {} }
print(#none, none:gaps()[1].molecule == mol "CCO" or none:gaps()[1].molecule == mol "CCBr") --> 0	true
print(none:gaps()[1].opens_target, getmetatable(none), getmetatable(kept)) --> true	false	false
