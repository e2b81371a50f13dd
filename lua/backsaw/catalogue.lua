-- catalogue.build and catalogue.open
local core = ...
local check = core.module "check"
local catalogues = {}

-- report = catalogue.build { from = "a.tsv" or { ... }, into = "x.catalogue" }
function catalogues.build(given)
    local fields = check.fields("catalogue.build", given, { from = "texts", into = "text" })
    if not fields.from or #fields.from == 0 then check.fail("catalogue.build: 'from' is missing") end
    if not fields.into then check.fail("catalogue.build: 'into' is missing") end
    for _, file in ipairs(fields.from) do check.path("catalogue.build", file) end
    return core.build_catalogue(fields.from, check.path("catalogue.build", fields.into))
end

-- c = catalogue.open(path)
function catalogues.open(path)
    return core.open_catalogue(check.path("catalogue.open", path))
end

return catalogues
