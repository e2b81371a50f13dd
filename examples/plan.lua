-- Planning a delivery. The scenario is invented, and so are the prices: Quayside bench, a small
-- contract group, owes a customer 25 g each of moclobemide and of butamben, and wants to order
-- everything this week.
--
-- Run it from anywhere: backsaw examples/plan.lua
-- What comes out is for a trained chemist to judge; the supplier's current safety data sheet and
-- local rules prevail.

local here = arg and arg[0] and arg[0]:match "^(.*)/[^/]*$" or "."

-- The demo catalogue, from the build if it is there, else made for this run.
local function open_demo()
    local file = io.open(here .. "/../build/demo.catalogue")
    if file then
        file:close()
        return catalogue.open(here .. "/../build/demo.catalogue")
    end
    local path = os.tmpname()
    os.remove(path)
    catalogue.build { from = here .. "/demo-catalogue.tsv", into = path }
    local shelf = catalogue.open(path)
    os.remove(path) -- stays readable while it is open
    return shelf
end

local shelf = open_demo()
print(string.format("%d offers in the demo catalogue", #shelf))

-- Days until the last compound of a route is on the bench.
local function days(route)
    local longest = 0
    for _, leaf in ipairs(route:leaves()) do
        longest = math.max(longest, leaf.lead_days or 0)
    end
    return longest
end

local targets = {
    { name = "moclobemide", smiles = "O=C(NCCN1CCOCC1)c1ccc(Cl)cc1" },
    { name = "butamben", smiles = "CCCCOC(=O)c1ccc(N)cc1" },
}

for _, target in ipairs(targets) do
    local routes = plan {
        target = target.smiles,
        catalogue = shelf,
        limits = { depth = 3, molecules = 2000 },
        cost = cost.per_mole { step = 80 },
        -- Quayside has no glovebox and wants no heavy metals in the waste.
        allow = function(step)
            return not (step:uses "mercury" or step:uses "tin" or step:uses "butyllithium")
        end,
        keep = function(route) return route:measure().steps > 0 end, -- made, not bought
        best = 8,
        quiet = true,
    }
    print()
    print(string.format("%s, %s g/mol: %d routes", target.name,
        string.format("%.2f", mol(target.smiles):mass()), #routes))
    if #routes > 0 then
        print(routes)
        local soon = routes:where(function(route) return days(route) <= 14 end)
            :sort(function(route) return route:measure().longest * 1000 + route.cost end)
        local choice = soon[1] or routes[1]
        print(string.format("\nshortest of the %d routes that can be on the bench within 14 days:",
            #soon))
        print(choice)
        for _, leaf in ipairs(choice:leaves()) do
            if leaf.offer then
                local grams = 25 / mol(target.smiles):mass() * leaf.moles * leaf.molecule:mass()
                print(string.format("  %-9s %-40s %7.1f g for 25 g, %g days", leaf.code, leaf.name,
                    grams, leaf.lead_days or 0))
            end
        end
    end
end
