-- Options, scripts, commands: exit status and where the output goes.
local program = dofile(os.getenv "BACKSAW_CLI" .. "/program.lua")
local run, expect, file = program.run, program.expect, program.file

local function check(arguments, status, out, err, input)
    local result = run(arguments, input)
    expect("status " .. status, result, result.status == status)
    expect("output " .. out, result, result.out:find(out) ~= nil and (out ~= "^$" or result.out == ""))
    expect("error " .. err, result, result.err:find(err) ~= nil and (err ~= "^$" or result.err == ""))
end

check({ "--version" }, 0, "^backsaw %d", "^$")
check({ "--help" }, 0, "^usage: backsaw", "^$")
check({ "--bare", "-e", "print(1 + 1)" }, 0, "^2\n$", "^$")
check({ "--bare", "-e", "x = 3", "-e", "print(x)" }, 0, "^3\n$", "^$")
check({ "--bare", "-eprint(5)" }, 0, "^5\n$", "^$")
check({ "--bare", "-l", "quay", "-e", "print(transform 'quay ether')" }, 0, "^quay ether\n$", "^$")
check({ "--bare", "-" , "a", "b" }, 0, "^2\tb\n$", "^$", "print(#arg, (select(2, ...)))")
check({ "--bare" }, 0, "^from a pipe\n$", "^$", "print 'from a pipe'")
check({ "--bare", "-e", "os.exit(3)" }, 3, "^$", "^$")

local script = file "#!/usr/bin/env backsaw\nprint(arg[0] ~= nil, arg[1], ...)\n"
check({ "--bare", script, "x", "-e" }, 0, "^true\tx\tx\t%-e\n$", "^$")
check({ "--bare", "-i", script }, 0, "^true\tnil\n7\n$", "^$", "3 + 4\n")
os.remove(script)

-- wrong usage
check({ "--frob" }, 2, "^$", "unknown option '%-%-frob'")
check({ "-e" }, 2, "^$", "code is expected")
check({ "-l" }, 2, "^$", "name of a pack is expected")
check({ "--bare", "check" }, 2, "^$", "a pack is expected")
check({ "--bare", "check", "--frob" }, 2, "^$", "unknown option")
check({ "--bare", "catalogue" }, 2, "^$", "'build' is expected")
check({ "--bare", "catalogue", "make" }, 2, "^$", "unknown command 'make'")
check({ "--bare", "catalogue", "build" }, 2, "^$", "list of compounds is expected")
check({ "--bare", "catalogue", "build", "x.tsv" }, 2, "^$", "%-o OUT is missing")
check({ "--bare", "plan" }, 2, "^$", "a SMILES is expected")
check({ "--bare", "plan", "C", "CC" }, 2, "^$", "'CC' is another")
check({ "--bare", "plan", "C", "-n", "none" }, 2, "^$", "whole number")
check({ "--bare", "plan", "C", "-c" }, 2, "^$", "a value is expected")

-- help of the commands
for _, command in ipairs { "check", "pack", "catalogue", "plan" } do
    check({ "--bare", command, "--help" }, 0, "^usage: backsaw " .. command, "^$")
end

-- check
check({ "--bare", "check", "quay" }, 0, "quay: 1 transform, 3 self%-tests, 2 warnings, 0 failed\n$", "^$")
local wrong = file [[
interconversion "wrong" { target = "[CX4;H2:1][OX2H:2]", from = "[C:1]=[O:2]",
    example { "CCO", from = { "CCN" } }, refuse { "CCCO" } }
]]
check({ "--bare", "check", wrong }, 1, "CCO is not made from.*CCCO is not refused.*2 failed\n", "^$")
os.remove(wrong)

-- catalogue and plan
local list = file("smiles\tname\nCCO\tethanol\nC(C\tbroken\n", ".tsv")
local out = list .. ".catalogue"
check({ "--bare", "catalogue", "build", list, "-o", out }, 0, "1 offers\n$", "1 of 2 lines left out")
check({ "--bare", "plan", "CCO", "-c", out }, 0, "CCO", "^$")
check({ "--bare", "plan", "CCN", "-c", out }, 1, "^$", "no route to CCN was found")
check({ "--bare", "plan", "O" }, 0, "O", "no catalogue given")
check({ "--bare", "plan", "CCO", "-c", out, "--not-bought", "OCC" }, 1, "^$", "no route to CCO")
check({ "--bare", "plan", "CCN", "-c", out, "--start-from", "NCC" }, 0, "CCN", "^$")
check({ "--bare", "plan", "CCO", "-c", out, "--convergent", "--protections", "0" }, 1, "^$", "no route")
check({ "--bare", "plan", "[CH3:1][CH2:2]O", "-c", out, "--keep", "1,2" }, 0, "CCO", "^$")
check({ "--bare", "plan", "[CH3:1][CH2:2]O", "-c", out, "--cut", "1,2" }, 1, "^$", "no route")
check({ "--bare", "plan", "[CH3:1]CO", "--cut", "1" }, 2, "^$", "map numbers such as 1,2 are expected, not '1'")
check({ "--bare", "plan", "[CH3:1]CO", "--first", "1,5" }, 1, "^$", "no atom of the target has the map number 5")
check({ "--bare", "plan", "C", "--use-compound", "C(" }, 1, "^$", "%^")
local saved = os.tmpname()
check({ "--bare", "plan", "CCO", "-c", out, "-o", saved }, 0, "CCO", "^$")
check({ "--bare", "-e", "print(#routes.load(arg[1]))", "-", saved }, 0, "^1\n", "^$", "")
os.remove(saved)
check({ "--bare", "plan", "CCO", "-c", out, "-o", "no/such/folder/r.json" }, 1, "^$", "cannot be written")
os.remove(list)
os.remove(out)

program.finish()
