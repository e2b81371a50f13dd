-- mol.read, mol.each, mol.write and mol.writer: the molecules of a file.
local core = ...
local check = core.module "check"
local files = {}

local function open(what, path, refused)
    check.path(what, path)
    if refused ~= nil and type(refused) ~= "function" then
        check.fail("%s: a function for records that cannot be read is expected, not a %s", what,
            type(refused))
    end
    return core.open_molecules(path)
end

-- The next molecule, or nil at the end. Records that cannot be read go to `refused`, or are raised.
local function following(file, refused)
    while true do
        local m, problem = file:next()
        if not problem then return m end
        if not refused then error(problem, 0) end
        refused(problem)
    end
end

-- list = mol.read(path [, refused])
function files.read(path, refused)
    local file <close> = open("mol.read", path, refused)
    local list, m = {}, following(file, refused)
    while m do
        list[#list + 1] = m
        m = following(file, refused)
    end
    return list
end

-- for m in mol.each(path [, refused]) do ... end
function files.each(path, refused)
    local file = open("mol.each", path, refused)
    return function()
        local m = following(file, refused)
        return m
    end, nil, nil, file
end

-- w = mol.writer(path): w:write(m [, { name = ..., fields = { ... } }]), w:close()
function files.writer(path)
    check.path("mol.writer", path)
    return core.create_molecules(path)
end

-- mol.write(path, list): the molecules of a list into a file
function files.write(path, list)
    check.path("mol.write", path)
    if type(list) ~= "table" then
        check.fail("mol.write: a list of molecules is expected, not a %s", type(list))
    end
    local writer <close> = core.create_molecules(path)
    for _, m in ipairs(list) do writer:write(m) end
end

return files
