-- Processor time a molecule of a search that grows: usage: backsaw tests/bench/search.lua SIZE...
-- Plans a dihydropyridine with nothing on the shelf, so that the
-- search goes on until each size is reached, by extending the one before. Run by hand.
local target = mol "CCOC(=O)C1=C(COCCN)NC(C)=C(C(=O)OC)C1c1ccccc1Cl"
local sizes = {}
for i, text in ipairs(arg) do sizes[i] = assert(math.tointeger(tonumber(text)), "a size is expected") end
assert(sizes[1], "usage: backsaw tests/bench/search.lua SIZE...")

local routes, last = nil, 0
for _, size in ipairs(sizes) do
    local before = os.clock()
    if routes then
        routes = routes:extend { molecules = size }
    else
        routes = plan { target = target, catalogue = { "C" }, limits = { depth = 30, molecules = size },
            clashes = "allow", best = 1, quiet = true }
    end
    local seconds = os.clock() - before
    print(string.format("%8d molecules  %7.2f s  %.3f ms a molecule  %s", size, seconds,
        seconds / (size - last) * 1000, routes.reason or "complete"))
    last = size
end
