-- JSON (RFC 8259) from plain tables. A table with entries from 1 on, or one made by json.list(), is
-- an array; the keys of an object are sorted.
local core = ...
local json = {}
local lists = setmetatable({}, { __mode = "k" })

-- Marks a table as an array, which matters where it may be empty.
function json.list(t)
    lists[t] = true
    return t
end

local short = { ['"'] = '\\"', ["\\"] = "\\\\", ["\n"] = "\\n", ["\r"] = "\\r", ["\t"] = "\\t" }

local function escaped(byte)
    return short[byte] or string.format("\\u%04x", string.byte(byte))
end

-- Bytes that are no UTF-8 become U+FFFD, so that every reader takes the text.
local function whole(text)
    local parts, at = {}, 1
    while at <= #text do
        local good, bad = utf8.len(text, at)
        if good then
            parts[#parts + 1] = string.sub(text, at)
            break
        end
        parts[#parts + 1] = string.sub(text, at, bad - 1) .. "\u{FFFD}"
        at = bad + 1
    end
    return table.concat(parts)
end

local function quoted(text)
    return '"' .. string.gsub(whole(text), '[%c"\\]', escaped) .. '"'
end

local function number(value)
    if math.type(value) == "integer" then return tostring(value) end
    if value ~= value or value == math.huge or value == -math.huge then return "null" end
    return string.format("%.14g", value)
end

local write

local function write_list(t, out, indent)
    if #t == 0 then
        out[#out + 1] = "[]"
        return
    end
    local inner = indent .. "  "
    for i, value in ipairs(t) do
        out[#out + 1] = (i == 1 and "[\n" or ",\n") .. inner
        write(value, out, inner)
    end
    out[#out + 1] = "\n" .. indent .. "]"
end

local function write_object(t, out, indent)
    local keys, inner = {}, indent .. "  "
    for key in next, t do keys[#keys + 1] = key end
    table.sort(keys)
    for i, key in ipairs(keys) do
        out[#out + 1] = (i == 1 and "{\n" or ",\n") .. inner .. quoted(key) .. ": "
        write(t[key], out, inner)
    end
    out[#out + 1] = #keys == 0 and "{}" or "\n" .. indent .. "}"
end

function write(value, out, indent)
    local kind = type(value)
    if kind == "table" and (lists[value] or value[1] ~= nil) then
        write_list(value, out, indent)
    elseif kind == "table" then
        write_object(value, out, indent)
    elseif kind == "string" then
        out[#out + 1] = quoted(value)
    elseif kind == "number" then
        out[#out + 1] = number(value)
    elseif kind == "boolean" then
        out[#out + 1] = tostring(value)
    else
        core.fail("internal error", "json: a " .. kind .. " cannot be written")
    end
end

-- text = json.text(value), without an end of line behind
function json.text(value)
    local out = {}
    write(value, out, "")
    return table.concat(out)
end

return json
