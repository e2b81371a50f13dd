-- usage: backsaw docs.lua DOCUMENT
-- Runs the blocks of Lua code in a document, one after the other in one environment, and compares
-- what each prints with its comments that begin with an arrow. A block without such comments has
-- to run, whatever it prints.
local path = assert(arg[1], "a document is expected")
local file = assert(io.open(path))
local text = file:read "a"
file:close()

local printed
local env = setmetatable({}, { __index = _G })

function env.print(...)
    local values = table.pack(...)
    for i = 1, values.n do values[i] = tostring(values[i]) end
    for line in (table.concat(values, "\t") .. "\n"):gmatch "([^\n]*)\n" do
        printed[#printed + 1] = (line:gsub("%s+$", ""))
    end
end

-- The blocks with the lines before them replaced by empty ones, so that messages fit.
local blocks, lines = {}, 0
local block
for line in (text .. "\n"):gmatch "([^\n]*)\n" do
    lines = lines + 1
    if block and line:match "^```" then
        blocks[#blocks + 1], block = block, nil
    elseif block then
        block.text[#block.text + 1] = line
        local comment = line:match "%-%->%s?(.*)$"
        if comment then block.expected[#block.expected + 1] = (comment:gsub("%s+$", "")) end
    elseif line:match "^```lua%s*$" then
        block = { line = lines, text = {}, expected = {} }
    end
end

local bad = 0
for _, one in ipairs(blocks) do
    printed = {}
    local source = string.rep("\n", one.line) .. table.concat(one.text, "\n")
    local chunk, problem = load(source, "@" .. path, "t", env)
    local ok = chunk ~= nil
    if ok then ok, problem = xpcall(chunk, function(e) return tostring(e) end) end
    if not ok then
        io.stderr:write(problem, "\n")
        bad = bad + 1
    end
    for i = 1, #one.expected > 0 and math.max(#one.expected, #printed) or 0 do
        if one.expected[i] ~= printed[i] then
            io.stderr:write(string.format("%s:%d: line %d of the output\n  expected %s\n  printed  %s\n",
                path, one.line, i, tostring(one.expected[i]), tostring(printed[i])))
            bad = bad + 1
        end
    end
end
os.exit(bad == 0, true)
