-- Checking what people wrote in tables: names of fields, types of values, with a guess at what
-- was meant. Used by the words for packs and by `plan`. String functions are called as functions
-- throughout, because strings have fewer methods in the pack state.
local core = ...
local check = {}

local sub, lower, format, sort = string.sub, string.lower, string.format, table.sort

-- Edits between two words, to find what was meant: letters changed, left out, added or swapped
-- with their neighbour (Damerau 1964).
local function distance(a, b)
    local before, last, row = {}, {}, {}
    for j = 0, #b do last[j] = j end
    for i = 1, #a do
        row = { [0] = i }
        for j = 1, #b do
            local same = sub(a, i, i) == sub(b, j, j)
            local best = math.min(last[j - 1] + (same and 0 or 1), last[j] + 1, row[j - 1] + 1)
            if i > 1 and j > 1 and sub(a, i, i) == sub(b, j - 1, j - 1)
                and sub(a, i - 1, i - 1) == sub(b, j, j) then
                best = math.min(best, before[j - 2] + 1)
            end
            row[j] = best
        end
        before, last = last, row
    end
    return last[#b]
end

-- The word of a list that is nearest to `word`, or nil if none is near.
function check.nearest(word, words)
    local best, least
    if #word > 60 then return nil end
    for _, candidate in ipairs(words) do
        if #candidate <= 60 then
            local d = distance(lower(word), lower(candidate))
            if not least or d < least then best, least = candidate, d end
        end
    end
    if best and least <= math.max(1, #word // 3) then return best end
end

-- "; did you mean 'x'?" or nothing.
function check.meant(word, words)
    local near = check.nearest(word, words)
    return near and format("; did you mean '%s'?", near) or ""
end

function check.fail(...)
    core.fail("bad value", format(...))
end

-- A file name; `what` begins the message.
function check.path(what, value)
    if type(value) ~= "string" then
        check.fail("%s: a file name is expected, not a %s", what, type(value))
    end
    if string.find(value, "\0", 1, true) then check.fail("%s: a NUL byte in the file name", what) end
    return value
end

local function sorted_keys(t)
    local keys = {}
    for key in next, t do keys[#keys + 1] = key end
    sort(keys)
    return keys
end
check.sorted_keys = sorted_keys

-- The keys of a table that are texts, in order.
function check.sorted_texts(t)
    local keys = {}
    for key in next, t do
        if type(key) == "string" then keys[#keys + 1] = key end
    end
    sort(keys)
    return keys
end

local function shown(key)
    return type(key) == "string" and sub(key, 1, 60) or type(key) == "number" and tostring(key)
        or type(key)
end

local kinds = {}

function kinds.text(value)
    if type(value) == "string" then return value end
    return nil, "a string"
end

function kinds.number(value)
    if type(value) == "number" and value == value then return value end
    return nil, "a number"
end

-- A whole number from 1 on.
function kinds.count(value)
    local whole = math.tointeger(value)
    if whole and whole >= 1 and whole <= 2^31 - 1 then return whole end
    return nil, "a whole number from 1 on"
end

-- A number from 0 on.
function kinds.amount(value)
    if type(value) == "number" and value >= 0 and value < math.huge then return value end
    return nil, "a number of 0 or more"
end

function kinds.flag(value)
    if type(value) == "boolean" then return value end
    return nil, "true or false"
end

function kinds.code(value)
    if type(value) == "function" then return value end
    return nil, "a function"
end

function kinds.texts(value)
    if type(value) == "string" then return { value } end
    if type(value) ~= "table" then return nil, "a list of strings" end
    local list, count = {}, 0
    for key in next, value do
        if math.type(key) ~= "integer" then return nil, "a list of strings" end
        count = count + 1
    end
    for i = 1, count do
        local item = rawget(value, i)
        if type(item) ~= "string" then return nil, "a list of strings" end
        list[i] = item
    end
    return list
end

-- Two numbers from 0 to 100, or one.
function kinds.percent(value)
    local low, high = value, value
    if type(value) == "table" then low, high = rawget(value, 1), rawget(value, 2) end
    if type(low) == "number" and type(high) == "number" and low > 0 and low <= high
        and high <= 100 then
        return { low, high }
    end
    return nil, "a range in per cent such as { 70, 90 }"
end

-- Two map numbers.
function kinds.maps(value)
    if type(value) == "table" then
        local a, b = rawget(value, 1), rawget(value, 2)
        if math.type(a) == "integer" and math.type(b) == "integer" and a > 0 and b > 0
            and a < 1000 and b < 1000 then
            return { a, b }
        end
    end
    return nil, "two map numbers such as { 1, 2 }"
end

-- A map number and the name of a synthon.
function kinds.stop(value)
    if type(value) == "table" then
        local map, name = rawget(value, 1), rawget(value, 2)
        if math.type(map) == "integer" and map > 0 and map < 1000 and type(name) == "string" then
            return { map, name }
        end
    end
    return nil, 'a map number and a synthon such as { 1, "alkyl" }'
end

-- Copies the named fields of `given` that `fields` (name to kind) allows; `what` begins the
-- messages. Numbered entries are left to the caller.
function check.fields(what, given, fields)
    if type(given) ~= "table" then
        check.fail("%s: a table is expected, not a %s", what, type(given))
    end
    local result = {}
    for key, value in next, given do
        if math.type(key) ~= "integer" then
            local kind = fields[key]
            if not kind then
                local meant = type(key) == "string" and check.meant(key, sorted_keys(fields)) or ""
                check.fail("%s: unknown field '%s'%s", what, shown(key), meant)
            end
            if kind == "any" then
                result[key] = value
            else
                local good, expected = kinds[kind](value)
                if good == nil then
                    local got = type(value) == "number" and tostring(value)
                        or type(value) == "table" and "this table" or "a " .. type(value)
                    check.fail("%s: '%s' must be %s, not %s", what, key, expected, got)
                end
                result[key] = good
            end
        end
    end
    return result
end

-- The entries 1 to n of a table; a hole is an error.
function check.entries(what, given)
    local count = 0
    for key in next, given do
        if math.type(key) == "integer" then count = count + 1 end
    end
    local list = {}
    for i = 1, count do
        local entry = rawget(given, i)
        if entry == nil then check.fail("%s: a hole in the list; entry %d is nil", what, i) end
        list[i] = entry
    end
    return list
end

return check
