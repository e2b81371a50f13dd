-- The prompt on a pipe: expressions, statements over several lines, errors, and going on.
local program = dofile(os.getenv "BACKSAW_CLI" .. "/program.lua")
local run, expect = program.run, program.expect

local function check(input, out, err, status)
    local result = run({ "--bare", "-i" }, input)
    expect("output of " .. input, result, result.out == out)
    expect("error of " .. input, result, err == "" and result.err == "" or result.err:find(err, 1, true))
    expect("status of " .. input, result, result.status == (status or 0))
end

check("1 + 1\n", "2\n", "")
check("x = 3\nx, 'a'\n", "3\ta\n", "")
check("for i = 1, 2 do\nprint(i)\nend\n", "1\n2\n", "")
check("1 +\n2\n", "3\n", "")
check("mol 'OCC':formula()\n", "C2H6O\n", "")
check("{ 1, 'b', { 2, c = 3 } }\n", "  1  1\n  2  b\n  3  { 2, c = 3 }\n", "")
check("nil\n", "nil\n", "")
check("{}\n", "{}\n", "")
check("error 'boo'\n4\n", "4\n", "boo")
check("mol 'C(C'\n5\n", "5\n", "^")
check("x = = 1\n6\n", "6\n", "unexpected symbol")
check("f(\n", "", "incomplete", 1)
check("\n\n7\n", "7\n", "")
check("local y = 1\n", "", "")
check("mol 'CC':find 'C'\n", "  1  { 1 }\n  2  { 2 }\n", "")
check("print 'a' print 'b'\n", "a\nb\n", "")
check("os.exit(4)\n", "", "", 4)

program.finish()
