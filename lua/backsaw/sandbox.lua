-- The environment of packs: an allow list, copied anew for each pack, so that what a pack assigns
-- harms itself alone. Packs have no pcall, no coroutines and no metatables, so nothing in them can
-- catch the end of the budget; no clock, no chance, no files.
local core = ...
local words = core.module "pack"
local group_words = core.module("group").words

local sandbox = {}
local rep, format, find, type, tostring = string.rep, string.format, string.find, type, tostring
local sort, concat = table.sort, table.concat

local LONGEST = 256 * 1024 -- bytes of a string, as for all strings of a pack

-- The text of a value without an address.
local function text_of(value)
    local kind = type(value)
    if kind == "table" or kind == "function" or kind == "thread" then return kind end
    return tostring(value)
end

local function bounded_rep(text, count, separator)
    separator = separator or ""
    if type(text) == "string" and type(count) == "number" and type(separator) == "string"
        and count > 0 and (count > LONGEST or (#text + #separator) * count > LONGEST) then
        core.fail("limit reached", "string.rep: more than 256 KiB")
    end
    return rep(text, count, separator)
end

local function plain_format(pattern, ...)
    if type(pattern) == "string" and find(pattern, "%p", 1, true) then
        core.fail("bad value", "string.format: %p is not available in a pack")
    end
    local values = table.pack(...)
    for i = 1, values.n do
        if type(values[i]) == "table" or type(values[i]) == "function" then
            values[i] = text_of(values[i])
        end
    end
    return format(pattern, table.unpack(values, 1, values.n))
end

-- Numbers ascending, then strings bytewise: the same order in each run.
local function ordered_pairs(t)
    if type(t) ~= "table" then
        core.fail("bad value", format("pairs: a table is expected, not a %s", type(t)))
    end
    local numbers, texts = {}, {}
    for key in next, t do
        if type(key) == "number" then
            numbers[#numbers + 1] = key
        elseif type(key) == "string" then
            texts[#texts + 1] = key
        else
            core.fail("bad value", format("pairs: a key is a %s; numbers and strings are expected",
                type(key)))
        end
    end
    sort(numbers)
    sort(texts)
    local keys = table.move(texts, 1, #texts, #numbers + 1, numbers)
    local i = 0
    return function()
        i = i + 1
        local key = keys[i]
        if key ~= nil then return key, t[key] end
    end
end

local function say(...)
    local values = table.pack(...)
    for i = 1, values.n do values[i] = text_of(values[i]) end
    core.say(concat(values, "\t"))
end

local function pick(library, names)
    local copy = {}
    for _, name in ipairs(names) do copy[name] = library[name] end
    return copy
end

local function string_copy()
    local copy = pick(string, { "byte", "char", "len", "lower", "reverse", "sub", "upper" })
    copy.rep, copy.format = bounded_rep, plain_format
    return copy
end

-- What the methods of strings are in the pack state; no pack holds this table.
sandbox.strings = string_copy()

-- mol "SMILES"; what reads files says that there are none, whatever the name.
local function molecule_word()
    local word = {}
    for _, name in ipairs { "read", "each" } do
        word[name] = function()
            core.fail("bad value", format("mol.%s: a pack reads no files", name))
        end
    end
    return setmetatable(word, {
        __call = function(_, value)
            local m = core.mol(value) -- no tail call, so that messages name it
            return m
        end,
        __metatable = false,
    })
end

function sandbox.environment()
    local env = {
        assert = assert, error = error, ipairs = ipairs, pairs = ordered_pairs, print = say,
        select = select, tonumber = tonumber, tostring = text_of, type = type, _VERSION = _VERSION,
        string = string_copy(),
        table = pick(table, { "concat", "insert", "pack", "remove", "sort", "unpack" }),
        math = pick(math, { "abs", "ceil", "exp", "floor", "fmod", "huge", "log", "max",
            "maxinteger", "min", "mininteger", "modf", "pi", "sqrt", "tointeger", "type", "ult" }),
        mol = molecule_word(), pattern = core.pattern, rewrite = core.rewrite, use = core.use,
    }
    for name, word in next, words do env[name] = word end
    for name, word in next, group_words do env[name] = word end
    env._G = env
    return env
end

return sandbox
