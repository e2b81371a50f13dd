-- Why a search ended as it did. What the answers must be follows from the known steps by hand.
local known = {
    { product = "CCN", from = { "CCBr", "N" }, yield = 50, cost = 10, name = "amination" },
    { product = "CCBr", from = { "CCO", "Br" }, yield = 80, cost = 4, name = "bromination" },
    { product = "CCO", from = { "CC=O", "[H][H]" }, yield = 80, cost = 4, name = "reduction" },
    { product = "CC=O", from = { "C=C", "O" }, yield = 80, cost = 4, name = "oxidation" },
    { product = "CCN", from = { "CC#N", "[H][H]" }, cost = 10, name = "hydrogenation" },
    { product = "CC#N", from = "CC(N)=O", name = "dehydration" },
    { product = "CCN", from = { "CCNC(C)=O", "O" }, cost = 10, name = "hydrolysis" },
    { product = "CC(N)=O", from = { "CC(=O)OC", "N" }, name = "aminolysis" },
}
local path = os.tmpname()
local function search(more)
    local given = { target = "CCN", catalogue = { { "CCBr", per_mole = 5 } }, known = known, transforms = {},
        limits = { depth = 3 }, trace = path,
        allow = function(step) return step.transform ~= "hydrolysis" and step.transform ~= "dehydration" end }
    for key, value in pairs(more or {}) do given[key] = value end
    return plan(given)
end
local list = search()
print(#list) --> 1
for _, smiles in ipairs { "CCN", "CCBr", "CCO", "CC=O", "C=C", "CC#N", "CC(=O)NCC", "Br" } do
    print(list:why(smiles).state, list:why(smiles))
end
--> made	CCN: made in route 1
--> bought	CCBr: bought in route 1; sold at 5.00 a mole; 1 step makes it, none for less
--> gap	CCO: 1 step makes it, but none from what can be had; CC=O is lacking
--> too_deep	CC=O: it lies 3 steps from the target, where the limit of depth ends the search
--> unknown	C=C: the search never met it: no step that was taken in needs it
--> refused	CC#N: 1 step makes it, all refused: 1 by 'allow'
--> unknown	CC(=O)NCC: the search never met it: no step that was taken in needs it
--> closed	Br: sold at 0.00 a mole; it is at hand or bought, so nothing was looked for that makes it
local why = list:why(mol "CCO")
print(why.molecule == mol "OCC", why.lacks == mol "CC=O", why.depth, why.steps, why.refused) --> true	true	2	1	0
print(list:why("CCBr").bought[1], #list:why("CCBr").made, list:why("CCN").made[1]) --> 1	0	1

local open = {}
for i, answer in ipairs(list:unsolved()) do open[i] = tostring(answer.molecule) end
print(table.concat(open, " ")) --> CC#N CCO CC=O

-- constraints refuse, too; a route that is dearer than those listed
list = search { constraints = { avoid = "reduction" }, catalogue = { "CCBr", "CC(N)=O" }, allow = function() return true end }
print(list:why "CCO") --> CCO: 1 step makes it, all refused: 1 by constraints
list = search { catalogue = { "CCBr", { "CC(N)=O", per_mole = 500 } }, best = 1, allow = function() return true end }
print(#list, list:why("CC#N").state, list:why("CC(N)=O").state) --> 1	not_used	dear
-- lists made of it know the same, a file and a list of two searches do not
print(list:where(function() return false end):why("CC#N").state) --> not_used
print(list:merge(list):why("CCO").text) --> CCO: this list says nothing of its search

-- the trace: each line an object, in the order of the search
local lines, events = 0, {}
for line in io.lines(path) do
    lines = lines + 1
    local event = line:match '^{"event": "(%a+)"'
    if not event or line:sub(-1) ~= "}" then print("line", line) end
    events[event] = (events[event] or 0) + 1
end
print(events.route, events["end"], events.step, events.molecule == list.explored.molecules) --> 1	1	7	true
local function content()
    local file = assert(io.open(path, "rb"))
    local text = file:read "a"
    file:close()
    return text
end
search { threads = 1 }
local first = content()
search { threads = 2 }
print(content() == first, first:find('"transform": "hydrolysis", "known": true, "cost": 10, "verdict": "allow"', 1, true) ~= nil) --> true	true
os.remove(path)
print(fails(search, { trace = "no/such/folder/t.jsonl" })) --> no/such/folder/t.jsonl: cannot be written: No such file or directory
print(fails(list.why, list, 5)) --> why: a molecule or SMILES is expected, not a number

-- how transforms did: the diamine from the amino nitrile, and that from the dinitrile
interconversion "test reduction of a nitrile" { target = "[CX4;H2:1]-[NX3;H2:2]", from = "[C:1]#[N:2]" }
list = plan { target = "NCc1ccc(CN)cc1", catalogue = { "N#Cc1ccc(C#N)cc1" }, transforms = { "test reduction of a nitrile" } }
for _, count in ipairs(list:transforms()) do
    print(count.transform, count.tried, count.found, count.refused, count.used) --> test reduction of a nitrile	2	2	0	2
end
