-- What is in a pack, as plain tables, for the commands that look at packs.
local core = ...
local transforms = core.module "transform"
local groups = core.module "group"
local study = {}

local function collect(nth)
    local list, i = {}, 0
    while true do
        local one = nth(i)
        if one == nil then return list end
        i = i + 1
        if one then list[#list + 1] = one end
    end
end

-- All synthons in use, each with name kind origin equivalents.
function study.synthons() return collect(core.nth_synthon) end

-- All classes of conditions in use.
function study.conditions() return collect(core.nth_conditions) end

-- Names are compared without regard to case, spaces and hyphens.
function study.fold(name)
    return (string.gsub(string.lower(name), "[ %-]", ""))
end

-- The file in an origin, "file:line".
function study.file_of(origin)
    return string.match(origin or "", "^(.*):%d+$") or origin
end

local function base_of(path) return string.match(path, "[^/]*$") end

-- Has this text the header of a pack? Scripts and notes may lie in the same folder.
function study.is_pack(text)
    return text ~= nil and string.find(text, "%f[%w_]pack%s*[{(]") ~= nil
end

-- The pack of this number in core.packs().
function study.pack(number)
    for _, pack in ipairs(core.packs()) do
        if pack.number == number then return pack end
    end
end

-- Synthons do not say their pack; their file does.
function study.synthons_of(pack)
    local list = {}
    for _, one in ipairs(study.synthons()) do
        if one.origin and base_of(study.file_of(one.origin)) == base_of(pack.path) then
            list[#list + 1] = one
        end
    end
    return list
end

local function of_pack(list, pack)
    local result = {}
    for _, one in ipairs(list) do
        if one.pack == pack.name then result[#result + 1] = one end
    end
    return result
end

-- The transforms of a pack as tables, each with its value as `rule` and its self-tests as `tests`.
function study.transforms_of(pack)
    local list = {}
    for _, t in ipairs(transforms.all()) do
        if t.pack == pack.name then
            local one = core.describe(t)
            one.rule, one.tests = t, core.examples(core.transform_index(t))
            list[#list + 1] = one
        end
    end
    return list
end

-- The pack of this number: name version about path transforms groups conditions synthons.
function study.describe(number)
    local pack = study.pack(number)
    pack.transforms = study.transforms_of(pack)
    pack.groups = of_pack(groups.all(), pack)
    pack.conditions = of_pack(study.conditions(), pack)
    pack.synthons = study.synthons_of(pack)
    return pack
end

return study
