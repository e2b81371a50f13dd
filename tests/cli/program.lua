-- Runs the program as a child and says what it did. Used by the tests beside it.
local program = {}

local path = assert(arg[1], "the program is expected")
program.failures = 0

local function quoted(text)
    return "'" .. text:gsub("'", "'\\''") .. "'"
end

local function slurp(name)
    local file = assert(io.open(name, "rb"))
    local text = file:read "a"
    file:close()
    os.remove(name)
    return text
end

-- result = program.run({ arguments }, input): status, out, err; a signal counts as status 128 + n
function program.run(arguments, input)
    local out, err, feed = os.tmpname(), os.tmpname(), os.tmpname()
    local words = { quoted(path) }
    for _, word in ipairs(arguments) do words[#words + 1] = quoted(word) end
    local file = assert(io.open(feed, "wb"))
    file:write(input or "")
    file:close()
    local _, how, code = os.execute(string.format("%s <%s >%s 2>%s", table.concat(words, " "), feed,
        out, err))
    os.remove(feed)
    return { status = how == "exit" and code or 128 + code, out = slurp(out), err = slurp(err),
        command = table.concat(words, " ", 2) }
end

-- A file with this text; returns its name.
function program.file(text, extension)
    local name = os.tmpname()
    os.remove(name)
    name = name .. (extension or ".lua")
    local file = assert(io.open(name, "wb"))
    file:write(text)
    file:close()
    return name
end

function program.expect(what, result, holds)
    if holds then return end
    program.failures = program.failures + 1
    io.stderr:write(string.format("%s: backsaw %s\n  status %d\n  out %q\n  err %q\n", what,
        result.command, result.status, result.out, result.err))
end

function program.finish()
    os.exit(program.failures == 0, true)
end

return program
