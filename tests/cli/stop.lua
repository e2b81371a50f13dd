-- The line of progress on a terminal, and Ctrl-C. Terminals come from script(1) of util-linux.
local program = dofile(os.getenv "BACKSAW_CLI" .. "/program.lua")
local expect = program.expect
local path = assert(arg[1])

local function slurp(name)
    local file = io.open(name, "rb")
    if not file then return "" end
    local text = file:read "a"
    file:close()
    os.remove(name)
    return text
end

-- Runs a line of shell; the files it names are $OUT and $ERR.
local function shell(line)
    local out, err = os.tmpname(), os.tmpname()
    local _, how, code = os.execute(string.format("OUT=%s ERR=%s P='%s'; %s", out, err, path, line))
    return { status = how == "exit" and code or 128 + code, out = slurp(out), err = slurp(err), command = line }
end

local job = program.file [[
local known = { { product = "CCN", from = { "CCBr", "N" }, yield = 50, cost = 10 } }
local routes = plan { target = "CCN", catalogue = { "CCBr" }, known = known, transforms = {},
    quiet = arg[1] == "quiet" }
print(#routes)
]]

-- on a terminal there is a line, and it is gone in the end
local erase = "\r\27[K"
local result = shell(string.format("script -qec \"$P --bare %s\" /dev/null </dev/null >$OUT", job))
expect("progress on a terminal", result, result.out:find("1 molecules", 1, true))
local last
for at in result.out:gmatch "()\r\27%[K" do last = at end
expect("the line is erased", result, last and result.out:sub(last) == erase .. "1\r\n")

-- none when told so, and none into a file
result = shell(string.format("script -qec \"$P --bare %s quiet\" /dev/null </dev/null >$OUT", job))
expect("quiet", result, result.out == "1\r\n")
result = shell(string.format("script -qec \"$P --bare %s 2>$ERR\" /dev/null </dev/null >$OUT", job))
expect("redirected", result, result.out == "1\r\n" and result.err == "")
os.remove(job)

-- Ctrl-C ends an endless search, whose routes are kept, and says so; the script goes on
local mark = os.tmpname()
os.remove(mark)
local endless = program.file(string.format([[
interconversion "test growth" { target = "[CX4;H3:1][C:2]", from = "[C:1]C[C:2]" }
local known = { { product = "CCN", from = { "CCBr", "N" }, yield = 50, cost = 10 } }
local count = 0
local routes = plan { target = "CCN", catalogue = { "CCBr" }, known = known, transforms = { "test growth" },
    limits = { depth = 1000000, molecules = 10000000 }, cost = cost.additive { step = 0 }, best = 5,
    allow = function()
        count = count + 1
        if count == 5 then io.open(%q, "w"):close() end
        return true
    end }
print(#routes, routes.complete, routes.reason)
]], mark))
result = shell(string.format([[
"$P" --bare %s >$OUT 2>$ERR </dev/null & pid=$!
i=0
while [ ! -e %s ] && [ $i -lt 600 ]; do sleep 0.1; i=$((i + 1)); done
kill -INT $pid
wait $pid]], endless, mark))
expect("status after Ctrl-C", result, result.status == 0)
expect("routes after Ctrl-C", result, result.out == "1\tfalse\tthe search was stopped\n")
expect("a line about it", result, result.err == "the search was stopped; 1 route was found so far\n")
os.remove(mark)
os.remove(endless)

program.finish()
