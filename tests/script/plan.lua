-- Plans of known steps and of rules. Costs are worked out by hand from the formula of the design:
-- (sum of equivalents x cost of precursor + step cost) / yield.
local known = {
    { product = "CCN", from = { "CCBr", "N" }, yield = 50, cost = 10, name = "amination" },
    { product = "CCBr", from = { "CCO", "Br" }, yield = 80, cost = 4, name = "bromination" },
}

-- CCBr: (1 + 4) / 0.8 = 6.25; CCN: (6.25 + 10) / 0.5 = 32.5; ammonia and HBr are free
local routes = plan { target = mol "CCN", catalogue = { "CCO" }, known = known, transforms = {}, quiet = true }
print(#routes, routes[1].cost, routes.complete) --> 1	32.5	true
local measure = routes[1]:measure()
print(measure.steps, measure.longest, measure.cost, measure.yield) --> 2	2	32.5	40.0

-- buying at a price; a source before another
routes = plan { target = "CCN", catalogue = { { "CCO", per_mole = 9 }, { "CCBr", per_mole = 6 } },
    known = known, transforms = {} }
print(#routes, routes[1].cost, routes[2].cost) --> 2	32.0	52.5
routes = plan { target = "CCN", catalogue = { { "CCN" }, { "CCO" } }, known = known, transforms = {} }
print(#routes, routes[1].cost, routes[1]:measure().steps, routes[2].cost) --> 2	1.0	0	32.5

-- additive: 1 + 4 + 10
routes = plan { target = "CCN", catalogue = { "CCO" }, known = known, transforms = {},
    cost = cost.additive { step = 7 } }
print(routes[1].cost) --> 15.0

-- steps without a cost of their own get the model's, or the function's
local bare = { { product = "CCN", from = { "CCBr", "N" }, yield = 50 },
    { product = "CCBr", from = "CCO", yield = 80 } }
print(plan { target = "CCN", catalogue = { "CCO" }, known = bare, transforms = {},
    cost = cost.per_mole { step = 3 } }[1].cost) --> 16.0
print(plan { target = "CCN", catalogue = { "CCO" }, known = bare, transforms = {},
    cost = function(step) return step.product == mol "CCN" and 5 or 3 end }[1].cost) --> 20.0

-- allow, keep, rank
print(#plan { target = "CCN", catalogue = { "CCO" }, known = known, transforms = {},
    allow = function(step) return step.transform ~= "bromination" end }) --> 0
routes = plan { target = "CCN", catalogue = { "CCO", "CCBr" }, known = known, transforms = {},
    rank = function(route) return -route:measure().longest end }
print(#routes, routes[1]:measure().longest, routes[2]:measure().longest, routes[1].rank) --> 2	2	1	-2.0
print(#plan { target = "CCN", catalogue = { "CCO", "CCBr" }, known = known, transforms = {},
    keep = function(route) return route:measure().longest == 1 end }) --> 1
print(#plan { target = "CCN", catalogue = { "CCO" }, known = known, transforms = {}, limits = { depth = 1 } }) --> 0
print(#plan { target = "CCN", catalogue = { "CCO", "CCBr" }, known = known, transforms = {}, best = 1 }) --> 1
print(#plan { target = "CCN", known = known, transforms = {}, at_hand = { "CCO" } }) --> 1

-- an error in a function comes out as it was, and the session goes on
print(fails(plan, { target = "CCN", catalogue = { "CCO" }, known = known, transforms = {},
    allow = function() error("no more", 0) end })) --> no more
print(fails(plan, { target = "CCN", catalogue = { "CCO" }, known = known, transforms = {},
    cost = function() return "dear" end }):match "'cost' must give a number" or "not asked") --> not asked
print(fails(plan, { target = "CCN", catalogue = { "CCO" }, known = bare, transforms = {},
    cost = function() return "dear" end })) --> plan: 'cost' must give a number, not string

-- the same compounds under other conditions are another step; what a step says is kept
local two = { { product = "CCN", from = { "CCBr", "N" }, cost = 5, yield = 50, conditions = "ethanol", name = "amination" },
    { product = "CCN", from = { "N", "CCBr" }, cost = 5, yield = 40, conditions = "water", name = "amination",
      recipe = "NH3, H2O, 60 °C", source = "notebook 12", reagents = { "ammonia" }, cautions = { "bromoethane" } } }
routes = plan { target = "CCN", catalogue = { "CCBr" }, known = two, transforms = {} }
print(#routes, routes[1] == routes[2], routes[1].cost, routes[2].cost) --> 2	false	12.0	15.0
local step = routes[2]:steps()[1]
print(step.conditions, step.recipe, step.source, step.reagents[1], step.cautions[1]) --> water	NH3, H2O, 60 °C	notebook 12	ammonia	bromoethane
print(#routes:merge(routes), routes[1]:compare(routes[2]).steps.shared[1]) --> 2	nil

-- by rules
interconversion "test reduction of a nitrile" { target = "[CX4;H2:1]-[NX3;H2:2]", from = "[C:1]#[N:2]",
    yield = { 80, 80 } }
routes = plan { target = "NCc1ccccc1", catalogue = { "N#Cc1ccccc1" }, limits = { depth = 1 },
    transforms = { "test reduction of a nitrile" } }
print(#routes, routes[1].cost, routes[1]:steps()[1].transform) --> 1	63.75	test reduction of a nitrile

-- known steps join the rules: (1 + 8) / 0.9 = 10 beats 63.75
routes = plan { target = "NCc1ccccc1", catalogue = { "N#Cc1ccccc1" }, limits = { depth = 1 },
    known = { { product = "NCc1ccccc1", from = "N#Cc1ccccc1", cost = 8, yield = 90, name = "own" } },
    transforms = { "test reduction of a nitrile" } }
print(#routes, routes[1].cost, routes[1]:steps()[1].known, routes[2]:steps()[1].known) --> 2	10.0	true	false

-- what is refused
print(fails(plan, {})) --> plan: 'target' is missing
print(fails(plan, { target = 5 })) --> plan: target: a molecule or SMILES is expected, not a number
print(fails(plan, { target = "C", catalogue = "C" })) --> plan: 'catalogue' must be a catalogue or a list, not a string
print(fails(plan, { target = "C", catalogue = { 3 } })) --> plan: catalogue: entry 1: a molecule or SMILES is expected, not a number
print(fails(plan, { target = "C", catalogue = { { "C", per_mol = 3 } } })) --> plan: catalogue: entry 1: unknown field 'per_mol'; did you mean 'per_mole'?
print(fails(plan, { target = "C", limits = { deepth = 3 } })) --> plan: limits: unknown field 'deepth'; did you mean 'depth'?
print(fails(plan, { target = "C", limits = { depth = 0 } })) --> plan: limits: 'depth' must be a whole number from 1 on, not 0
print(fails(plan, { target = "C", best = 2.5 })) --> plan: 'best' must be a whole number from 1 on, not 2.5
print(fails(plan, { target = "C", transforms = { "none such" } })) --> no transform named 'none such'
print(fails(plan, { target = "C", cost = 5 })) --> plan: 'cost' must be cost.per_mole{...}, cost.additive{...} or a function
print(fails(plan, { target = "C", known = { { product = "C" } } })) --> plan: known step 1: 'from' is missing
print(fails(plan, { target = "C", known = { { product = "C", from = "CC", yield = 120 } } })) --> plan: known step 1: 'yield' must be above 0 and at most 100 per cent
print(fails(cost.per_mole, { step = -1 })) --> cost.per_mole: 'step' must be a number of 0 or more, or a function
