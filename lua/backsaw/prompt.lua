-- The prompt: how values are shown, and what can follow what was typed.
local core = ...
local prompt = {}

local shown_entries = 40

local function quoted(value)
    return type(value) == "string" and string.format("%q", value) or tostring(value)
end

-- Is this a plain table, without a text of its own?
local function is_plain(value)
    local meta = type(value) == "table" and debug.getmetatable(value)
    return type(value) == "table" and not (meta and meta.__tostring)
end

-- A plain table inside another, in one line.
local function inner(value)
    if not is_plain(value) then return quoted(value) end
    local parts = {}
    for i = 1, math.min(#value, 12) do
        parts[i] = is_plain(value[i]) and "{...}" or quoted(value[i])
    end
    if #value > 12 then parts[#parts + 1] = "..." end
    local keys = {}
    for key in next, value do
        if type(key) == "string" then keys[#keys + 1] = key end
    end
    table.sort(keys)
    for _, key in ipairs(keys) do
        local item = value[key]
        parts[#parts + 1] = key .. " = " .. (is_plain(item)
            and (#item > 0 and not is_plain(item[1]) and inner(item) or "{...}") or quoted(item))
    end
    return "{ " .. table.concat(parts, ", ") .. " }"
end

local function show_list(list)
    if #list == 0 and next(list) == nil then return print("{}") end
    for i = 1, math.min(#list, shown_entries) do
        print(string.format("%3d  %s", i, is_plain(list[i]) and inner(list[i]) or tostring(list[i])))
    end
    if #list > shown_entries then
        print(string.format("     ... and %d more", #list - shown_entries))
    end
    local keys = {}
    for key in next, list do
        if type(key) == "string" then keys[#keys + 1] = key end
    end
    table.sort(keys)
    for _, key in ipairs(keys) do print(string.format("     %s = %s", key, inner(list[key]))) end
end

-- Shows the values of an expression, each in full.
function prompt.show(...)
    local values = table.pack(...)
    if values.n == 1 and is_plain(values[1]) then return show_list(values[1]) end
    for i = 1, values.n do
        if is_plain(values[i]) then values[i] = inner(values[i]) end
    end
    print(table.unpack(values, 1, values.n))
end

-- The table of names that a value answers to.
local function names_of(value)
    if type(value) == "table" then return value end
    local meta = debug.getmetatable(value)
    local index = meta and meta.__index
    if type(index) == "table" then return index end
    if type(value) == "userdata" and type(index) == "function" then
        local _, methods = debug.getupvalue(index, 1)
        if type(methods) == "table" then return methods end
    end
end

-- What can follow `typed`, as whole texts, sorted.
function prompt.complete(typed)
    local path, separator, start = string.match(typed, "^([%a_][%w_%.]*)([%.:])([%w_]*)$")
    local value = _G
    if path then
        for name in string.gmatch(path, "[^%.]+") do
            value = type(value) == "table" and rawget(value, name) or nil
        end
    else
        start = string.match(typed, "^[%a_][%w_]*$")
    end
    local found, names = {}, start and names_of(value)
    if not names then return found end
    for name in next, names do
        if type(name) == "string" and string.sub(name, 1, #start) == start
            and (start ~= "" or string.sub(name, 1, 1) ~= "_") then
            found[#found + 1] = (path and path .. separator or "") .. name
        end
    end
    table.sort(found)
    return found
end

return prompt
