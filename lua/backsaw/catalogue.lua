-- catalogue.build and catalogue.open
local core = ...
local check = core.module "check"
local catalogues = {}

local function path_of(what, value)
    if type(value) ~= "string" then
        check.fail("%s: a file name is expected, not a %s", what, type(value))
    end
    if string.find(value, "\0", 1, true) then check.fail("%s: a NUL byte in the file name", what) end
    return value
end

-- report = catalogue.build { from = "a.tsv" or { ... }, into = "x.catalogue" }
function catalogues.build(given)
    local fields = check.fields("catalogue.build", given, { from = "texts", into = "text" })
    if not fields.from or #fields.from == 0 then check.fail("catalogue.build: 'from' is missing") end
    if not fields.into then check.fail("catalogue.build: 'into' is missing") end
    for _, file in ipairs(fields.from) do path_of("catalogue.build", file) end
    return core.build_catalogue(fields.from, path_of("catalogue.build", fields.into))
end

-- c = catalogue.open(path)
function catalogues.open(path)
    return core.open_catalogue(path_of("catalogue.open", path))
end

return catalogues
