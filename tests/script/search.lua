-- Searches that are kept: going on, and ranking anew. Costs are worked out by hand from
-- (sum of equivalents x cost of precursor + step cost) / yield.
local known = {
    { product = "CCN", from = { "CCBr", "N" }, yield = 50, cost = 10, name = "amination" },
    { product = "CCBr", from = { "CCO", "Br" }, yield = 80, cost = 4, name = "bromination" },
    { product = "CCN", from = { "CC=O", "N" }, yield = 100, cost = 20, name = "reductive amination" },
}
local function search(limits)
    return plan { target = "CCN", catalogue = { "CCO", { "CC=O", per_mole = 30 } }, known = known,
        transforms = {}, limits = limits, quiet = true }
end
local routes = search()
print(#routes, routes[1].cost, routes[2].cost, routes.complete) --> 2	32.5	50.0	true

-- other prices: (9 + 4) / 0.8 = 16.25; (16.25 + 10) / 0.5 = 52.5; 2 + 20 = 22
local dear = routes:rerank { catalogue = { { "CCO", per_mole = 9 }, { "CC=O", per_mole = 2 } } }
print(#dear, dear[1].cost, dear[2].cost) --> 2	22.0	52.5
for _, leaf in ipairs(dear[1]:leaves()) do print(leaf, leaf.price) end --> N	0.0
--> CC=O	2.0
-- the list before, and the search, are as they were
print(routes[1].cost, routes:rerank()[1].cost, routes:rerank()[2].cost) --> 32.5	32.5	50.0

-- other costs: steps with a cost of their own keep it; additive: 1 + 4 + 10, 30 + 20
print(routes:rerank { cost = cost.additive {} }[1].cost, routes:rerank { cost = cost.additive {} }[2].cost) --> 15.0	50.0

-- compounds struck; filters
local without = routes:rerank { without = "CCBr" }
print(#without, without[1].cost) --> 1	50.0
print(#routes:rerank { without = { "CCBr", mol "CC=O" } }, #routes:rerank { without = "CCN" }) --> 0	0
print(#routes:rerank { allow = function(step) return step.transform ~= "amination" end }) --> 1
print(#routes:rerank { keep = function(route) return route:measure().steps == 2 end }) --> 1
print(routes:rerank { rank = function(route) return route:measure().steps end }[1].cost) --> 50.0
print(#routes:rerank { limits = { steps = 1 } }, #routes:rerank { best = 1 }) --> 1	1
print(#routes:where(function(r) return r.cost < 40 end):rerank()) --> 2

-- a search in parts is the search in one go
local part = search { molecules = 2 }
print(#part, part.complete, part.reason) --> 0	false	the limit of 2 molecules was reached
local whole = part:extend { molecules = 100 }
print(#whole, whole[1].cost, whole.complete, whole[1] == routes[1], whole[2] == routes[2]) --> 2	32.5	true	true	true
print(whole.explored.molecules == routes.explored.molecules, #part) --> true	0
print(#part:rerank()) --> 2

-- by rules, in many parts and in one
local function ruled(limit)
    return plan { target = "CCOC(=O)c1ccc(N)cc1", catalogue = { "CCO", "Nc1ccc(C(=O)O)cc1" },
        limits = { molecules = limit, depth = 3 }, quiet = true }
end
local one, parts = ruled(300), ruled(20)
for limit = 60, 300, 40 do parts = parts:extend { molecules = limit, threads = limit % 3 + 1 } end
print(tostring(one) == tostring(parts), one.explored.steps == parts.explored.steps, one.reason == parts.reason) --> true	true	true

-- what is refused
print(fails(routes.rerank, routes, { prise = 3 })) --> rerank: unknown field 'prise'
print(fails(routes.extend, routes, { molecules = 0 })) --> extend: 'molecules' must be a whole number from 1 on, not 0
print(fails(routes.rerank, routes, { without = 3 })) --> rerank: without: entry 1: a molecule or SMILES is expected, not a number
print(fails(plan, { target = "CCN", catalogue = { "CCO" }, known = known, transforms = {}, quiet = true,
    keep = function(route) return routes:rerank { keep = function() return #routes:rerank() end } end })) --> the search is running

-- whether it can be made at all; by depth
local proof = plan { target = "CCN", catalogue = { "CCO", "CCBr" }, known = known, transforms = {}, strategy = "proof", quiet = true }
print(#proof, proof[1].cost, proof.reason) --> 1	22.0	the search ended with the proof that there is a route
print(#plan { target = "CCN", catalogue = { "CCCl" }, known = known, transforms = {}, strategy = "proof" }) --> 0
local breadth = plan { target = "CCN", catalogue = { "CCO", { "CC=O", per_mole = 30 } }, known = known,
    transforms = {}, strategy = "breadth", quiet = true }
print(#breadth, breadth[1].cost, breadth.complete) --> 2	32.5	true
print(fails(plan, { target = "CCN", strategy = "depth" })) --> plan: 'strategy' must be cheapest, proof or breadth, not 'depth'

-- terms and leaves: CCBr: (1 + 3 + 2 * 5) / 1 = 14; CCN: (14 + 3 + 2 * 5) / 1 = 27; with leaves at ten times
-- their price and nothing for what is free: (10 + 3) / 1 = 13, 16
local bare = { { product = "CCN", from = { "CCBr", "N" }, yield = 100 }, { product = "CCBr", from = "CCO", yield = 100 } }
local function priced(cost)
    return plan { target = "CCN", catalogue = { "CCO" }, known = bare, transforms = {}, cost = cost, quiet = true }
end
print(priced(cost.per_mole { step = 3, terms = { { 2, function() return 5 end } } })[1].cost) --> 27.0
local plain = priced(cost.per_mole { step = 3 })
print(plain[1].cost, plain:rerank { cost = cost.per_mole { step = 3, terms = { { 2, function() return 5 end } } } }[1].cost) --> 7.0	27.0
local tenfold = cost.per_mole { step = 3, leaf = function(molecule, price) return 10 * price end }
print(priced(tenfold)[1].cost, plain:rerank { cost = tenfold }[1].cost, priced(tenfold):rerank { cost = cost.per_mole { step = 3 } }[1].cost) --> 16.0	16.0	7.0
print(fails(priced, cost.per_mole { terms = { { 2, function() return -5 end } } })) --> cost.per_mole: term 1: must give a number of 0 or more, not -5
print(fails(priced, cost.per_mole { leaf = function() return -1 end })) --> leaf: must be a number of 0 or more
print(fails(priced, function() return -1 end)) --> cost: a step must cost a number of 0 or more
print(fails(cost.per_mole, { terms = { { -1, print } } })) --> cost.per_mole: term 1: { weight, function(step) } is expected, the weight 0 or more

-- routes that differ: the two ways to the ether share no joining step; the third shares its last one with the first
local ethers = {
    { product = "CCOCCC", from = { "CCBr", "CCCO" }, cost = 10, yield = 100, cautions = { "a", "b" } },
    { product = "CCOCCC", from = { "CCO", "CCCBr" }, cost = 20, yield = 100 },
    { product = "CCBr", from = "CCO", cost = 1, yield = 100 },
    { product = "CCBr", from = "CC", cost = 2, yield = 100 },
    { product = "CCCBr", from = "CCCO", cost = 1, yield = 100 },
}
local all = plan { target = "CCOCCC", catalogue = { "CCO", "CCCO", "CC" }, known = ethers, transforms = {}, quiet = true }
print(#all, all[1].cost, all[2].cost, all[3].cost) --> 3	13.0	14.0	23.0
local diverse = all:rerank { diverse = 0.5 }
print(#diverse, diverse[1].cost, diverse[2].cost, #all:rerank { diverse = 1 }) --> 2	13.0	23.0	3
print(fails(all.rerank, all, { diverse = 2 })) --> diverse: must be 0 to 1

-- the front: the dearer route by the same step is beaten, the one without cautions is not
local front = all:pareto { "cost", "cautions" }
print(#front, front[1].cost, front[2].cost, #all:pareto { "cost" }) --> 2	13.0	23.0	1
print(#all:pareto { function(route) return -route.cost end }, fails(all.pareto, all, { "beauty" })) --> 1	pareto: no measure named 'beauty'
