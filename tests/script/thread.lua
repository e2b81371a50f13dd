-- The same routes with any number of threads, by rules of the standard library and of a pack with
-- functions.
use "quay"
local shelf = { "Oc1ccccc1", "CCBr", "CCO", "CC(=O)O", "CC(=O)Cl", "Nc1ccccc1", "O=C(O)c1ccccc1", "NCCN1CCOCC1",
    "O=C(O)c1ccc(Cl)cc1", "O=C(Cl)c1ccc(Cl)cc1", "C1COCCN1", "NCCBr", "OCCN", "N#Cc1ccc(Cl)cc1" }

local function routes_of(target, threads)
    local routes = plan { target = target, catalogue = shelf, threads = threads, best = 20, quiet = true,
        limits = { depth = 4, molecules = 600 } }
    local texts = {}
    for i, route in ipairs(routes) do texts[i] = tostring(route) end
    return table.concat(texts, "\n"), #routes
end

for _, target in ipairs { "O=C(NCCN1CCOCC1)c1ccc(Cl)cc1", "CCOc1ccccc1" } do
    local one, count = routes_of(target, 1)
    print(count > 2, one == routes_of(target, 2), one == routes_of(target, 4), one == routes_of(target))
end
--> true	true	true	true
--> true	true	true	true
