-- usage: backsaw run.lua SCRIPT
-- Runs a script and compares what it prints, line by line, with the comments that begin with an
-- arrow (two hyphens and a greater-than sign), in the order of the file.
local path = assert(arg[1], "a script is expected")
local file = assert(io.open(path))
local text = file:read "a"
file:close()

local expected = {}
for line in text:gmatch "[^\n]*" do
    local comment = line:match "%-%->%s?(.*)$"
    if comment then expected[#expected + 1] = (comment:gsub("%s+$", "")) end
end

local printed = {}
local env = setmetatable({}, { __index = _G })

function env.print(...)
    local values = table.pack(...)
    for i = 1, values.n do values[i] = tostring(values[i]) end
    for line in (table.concat(values, "\t") .. "\n"):gmatch "([^\n]*)\n" do
        printed[#printed + 1] = (line:gsub("%s+$", ""))
    end
end

-- The message with which a function fails, without file and line.
function env.fails(f, ...)
    local ok, problem = pcall(f, ...)
    if ok then return "no error" end
    if type(problem) == "table" then return problem.message end
    return (tostring(problem):gsub("^[^:]*:%d+: ", ""))
end

assert(load(text, "@" .. path, "t", env))()

local bad = 0
for i = 1, math.max(#expected, #printed) do
    if expected[i] ~= printed[i] then
        io.stderr:write(string.format("%s: line %d of the output\n  expected %s\n  printed  %s\n",
            path, i, tostring(expected[i]), tostring(printed[i])))
        bad = bad + 1
    end
end
if #expected == 0 then io.stderr:write(path, ": nothing is expected\n") end
os.exit(bad == 0 and #expected > 0, true)
