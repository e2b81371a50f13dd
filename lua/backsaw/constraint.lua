-- The constraints of a plan: what the user wrote becomes plain lists for the search.
local core = ...
local check = core.module "check"
local constraints = {}

local fields = { avoid = "any", use = "any", at_most = "any", start_from = "any",
    not_bought = "any", intact = "any", keep = "any", cut = "any", first = "any",
    protections = "any", unprotect = "flag", longest = "count", convergent = "flag" }

-- A list of what may also be given alone.
local function entries(what, given)
    if type(given) ~= "table" then return { given } end
    check.fields(what, given, {})
    return check.entries(what, given)
end

local function molecules(what, given)
    local list = {}
    for i, entry in ipairs(entries(what, given)) do
        if type(entry) ~= "string" and not core.is_molecule(entry) then
            check.fail("%s: a molecule or SMILES is expected, not a %s", what, type(entry))
        end
        list[i] = core.mol(entry)
    end
    return list
end

local function patterns(what, given)
    local list = {}
    for i, entry in ipairs(entries(what, given)) do
        if type(entry) ~= "string" and not core.is_pattern(entry) then
            check.fail("%s: a pattern or SMARTS is expected, not a %s", what, type(entry))
        end
        list[i] = core.is_pattern(entry) and entry or core.pattern(entry)
    end
    return list
end

-- What a step is tested for, as in step:uses(x); or a transform.
local function test(what, entry)
    if type(entry) == "string" and #entry > 0 then return { word = entry } end
    if core.is_molecule(entry) then return { molecule = entry } end
    if core.is_pattern(entry) then return { pattern = entry } end
    if core.is_transform(entry) then return { transform = tostring(entry) } end
    check.fail("%s: a word, a molecule, a pattern or a transform is expected, not %s", what,
        entry == "" and "an empty string" or "a " .. type(entry))
end

local function tests(what, given)
    local list = {}
    for i, entry in ipairs(entries(what, given)) do list[i] = test(what, entry) end
    return list
end

local function amount(what, value)
    local whole = math.tointeger(value)
    if not whole or whole < 0 or whole > 1000000 then
        check.fail("%s: a whole number of 0 or more is expected", what)
    end
    return whole
end

-- { 1, x } or a list of such
local function limits(what, given)
    if type(given) ~= "table" then
        check.fail("%s: a number and what it is for are expected, such as { 1, \"ozone\" }", what)
    end
    local list = check.entries(what, given)
    if type(list[1]) ~= "table" then list = { list } end
    for i, entry in ipairs(list) do
        local pair = type(entry) == "table" and check.entries(what, entry) or {}
        if #pair ~= 2 then
            check.fail("%s: a number and what it is for are expected, such as { 1, \"ozone\" }", what)
        end
        list[i] = test(what, pair[2])
        list[i].most = amount(what, pair[1])
    end
    return list
end

-- The atoms of the target by map number.
local function marked(target)
    local atoms = {}
    for i, atom in ipairs(target:atoms()) do
        if atom.label and atom.label > 0 then
            if atoms[atom.label] then
                check.fail("plan: target: two atoms have the map number %d", atom.label)
            end
            atoms[atom.label] = i
        end
    end
    return atoms
end

-- The bonds between atoms of each list of map numbers, as pairs of atoms.
local function bonds(what, given, target, pairs_only)
    local list, atoms, bonded = {}, marked(target), target:bonds()
    if type(given) ~= "table" then check.fail("%s: map numbers such as { 1, 2 } are expected", what) end
    local groups = check.entries(what, given)
    if type(groups[1]) ~= "table" then groups = { groups } end
    for _, group in ipairs(groups) do
        local inside, before = {}, #list
        if type(group) ~= "table" or #group < 2 or pairs_only and #group ~= 2 then
            check.fail("%s: map numbers such as { 1, 2 } are expected", what)
        end
        for _, map in ipairs(check.entries(what, group)) do
            if not atoms[map] then
                check.fail("%s: no atom of the target has the map number %s", what, tostring(map))
            end
            inside[atoms[map]] = true
        end
        for _, bond in ipairs(bonded) do
            if inside[bond[1]] and inside[bond[2]] then list[#list + 1] = { bond[1], bond[2] } end
        end
        if #list == before then check.fail("%s: these atoms are not bonded", what) end
    end
    return list
end

-- read(given, target): plain lists, and the longest line or nil
function constraints.read(given, target)
    local c = check.fields("plan: constraints", given, fields)
    if #check.entries("plan: constraints", given) > 0 then
        check.fail("plan: constraints: named fields are expected, such as avoid = { ... }")
    end
    local function read(name, reader, ...)
        if c[name] ~= nil then c[name] = reader("plan: constraints: " .. name, c[name], ...) end
    end
    read("avoid", tests)
    read("use", tests)
    read("at_most", limits)
    read("start_from", molecules)
    read("not_bought", molecules)
    read("intact", patterns)
    read("keep", bonds, target)
    read("cut", bonds, target, true)
    read("first", bonds, target, true)
    read("protections", amount)
    local longest = c.longest
    c.longest = nil
    return c, longest
end

return constraints
