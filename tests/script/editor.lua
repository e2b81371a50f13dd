-- editor/backsaw.lua names every global, every method of every value, and the fields that values
-- show. What there is comes from the running program: its globals, the tables behind the locked
-- metatables, and the keys of values made here.
local file = assert(io.open(os.getenv "BACKSAW_SOURCE" .. "/editor/backsaw.lua"))
local text = file:read "a"
file:close()
print(text:find("---@meta", 1, true) == 1, load(text, "=editor", "t", {}) ~= nil) --> true	true

local missing, count = {}, 0
local function wants(what, line)
    count = count + 1
    if not ("\n" .. text):find("\n" .. line, 1, true) then missing[#missing + 1] = what end
end

-- globals: those that Lua has not
local lua = {}
for word in ([[_G _VERSION arg assert collectgarbage coroutine debug dofile error getmetatable io
    ipairs load loadfile math next os package pairs pcall print rawequal rawget rawlen rawset require
    select setmetatable string table tonumber tostring type utf8 warn xpcall]]):gmatch "%S+" do
    lua[word] = true
end
local globals = 0
for name, value in pairs(_G) do
    if not lua[name] then
        globals = globals + 1
        if type(value) == "table" then
            wants(name, name .. " = {}")
            for key in pairs(value) do wants(name .. "." .. key, "function " .. name .. "." .. key .. "(") end
        else
            wants(name, "function " .. name .. "(")
        end
    end
end
print(globals > 20) --> true

-- methods
local registry = debug.getregistry()
local core, modules = registry["backsaw.core"], registry["backsaw.modules"]
local function methods(class, list)
    local n = 0
    for name in pairs(list) do
        n = n + 1
        wants(class .. ":" .. name, "function " .. class .. ":" .. name .. "(")
    end
    return n > 0
end
local function index_of(value) return debug.getmetatable(value).__index end
local shelf = os.tmpname()
os.remove(shelf)
catalogue.build { from = os.getenv "BACKSAW_SOURCE" .. "/examples/demo-catalogue.tsv", into = shelf }
local offers = catalogue.open(shelf)
os.remove(shelf)
-- the functions of C behind an index function are its upvalues
local step = modules.step and core.step_type.__index
local step_methods
for i = 1, 10 do
    local name, value = debug.getupvalue(step, i)
    if name == "methods" then step_methods = value end
end
print(methods("Molecule", core.molecule_methods), methods("Pattern", index_of(pattern "C")),
    methods("Rewriting", index_of(rewrite "[C:1]>>[C:1]O")), methods("Transform", modules.transform.methods),
    methods("Catalogue", index_of(offers)), methods("Step", step_methods),
    methods("Route", core.route_methods), methods("Routes", core.routes_methods)) --> true	true	true	true	true	true	true	true

-- fields: of atoms, bonds, steps, product sets, offers, measures
local function fields(class, value)
    local block = text:match("%-%-%-@class backsaw%." .. class .. "\n(.-)\n\n") or ""
    local n = 0
    for key in pairs(value) do
        if type(key) == "string" then
            n = n + 1
            count = count + 1
            if not block:find("---@field " .. key .. " ", 1, true) then
                missing[#missing + 1] = class .. "." .. key
            end
        end
    end
    return n > 0
end
synthon "editor alkyl" { kind = "acceptor", equivalents = { "Br" } }
synthon "editor phenol" { kind = "donor", equivalents = { "[H]" } }
local ether = disconnection "editor ether" { target = "[CX4;H2:1]-!@[OX2:2][c:3]", cut = { 1, 2 },
    acceptor = { 1, "editor alkyl" }, donor = { 2, "editor phenol" }, recipe = "K2CO3", yield = { 80, 90 },
    source = "invented", conditions = "williamson" }
local list = plan { target = "CCOc1ccccc1", catalogue = { "CCBr", "Oc1ccccc1" }, transforms = { ether } }
local alanine = mol "N[C@@H](C)C(=O)O"
print(fields("Atom", alanine:atoms()[2]), fields("Bond", mol("C/C=C/C"):bonds()[2]),
    fields("Step", ether:back("CCOc1ccccc1")[1]), fields("Step", list[1]:steps()[1]),
    fields("ProductSet", ether:forth("CCBr", "Oc1ccccc1")[1]), fields("Measure", list[1]:measure()),
    fields("Offer", offers:find("CCCCCC")[1]), fields("Polarity", mol("CC(=O)CC(C)O"):polarity(4, 5))) --> true	true	true	true	true	true	true	true

table.sort(missing)
print("not in editor/backsaw.lua:", table.concat(missing, " ")) --> not in editor/backsaw.lua:
print(count > 100) --> true
