-- Malformed input of every kind: exit status 1 or 2, one line that says what and where, a caret
-- where there is a string; never a crash, an address or a name of a C function.
local program = dofile(os.getenv "BACKSAW_CLI" .. "/program.lua")
local run, expect, file = program.run, program.expect, program.file

local function check(what, arguments, words, input)
    local result = run(arguments, input)
    expect(what .. ": status", result, result.status == 1 or result.status == 2)
    expect(what .. ": output", result, result.out == "" or arguments[2] == "check")
    local text = result.err
    if arguments[2] == "check" then text = "backsaw: " .. result.out end
    local first = text:match "^[^\n]*"
    expect(what .. ": first line", result, first:match "^backsaw: ." and #first < 500)
    expect(what .. ": no insides", result,
        not text:find "bs_%l" and not text:find "bsl_" and not text:find "0x%x%x%x%x%x")
    for _, word in ipairs(words or {}) do expect(what .. ": " .. word, result, text:find(word, 1, true)) end
    return result
end

-- SMILES: with a caret
for _, smiles in ipairs { "C(C", "CC)", "C1CC", "C%1", "[C", "[Xx]", "CQ", "C==C", "C(", "(C)", "c1cccc1",
    "[C@@@H](F)(Cl)Br", "[13", "C[", "C..", "1CC", "[CH99]", "[C+999]", "CC=",
    "[]", "C=(C)1", "é", "" } do
    local name = "SMILES " .. smiles
    local result = check(name, { "--bare", "-e", "local m = mol [==[" .. smiles .. "]==]" }, { "-e:1: " })
    if smiles ~= "c1cccc1" and smiles ~= "" then
        expect(name .. ": caret", result, result.err:find "\n +%^\n$" ~= nil)
    end
end

-- SMARTS: with a caret
for _, smarts in ipairs { "[C", "[C;", "C)", "C(C", "[$(CC]", "[#]", "C1CC", "[C&]", "[Q]", "[]", "[C,]",
    "C-", "[$(", "[!]", "[D99999999999]" } do
    local name = "SMARTS " .. smarts
    local result = check(name, { "--bare", "-e", "local p = pattern [==[" .. smarts .. "]==]" }, { "-e:1: " })
    expect(name .. ": caret", result, result.err:find "\n +%^\n$" ~= nil)
end

-- reaction SMARTS
for _, text in ipairs { "C", "C>>", "[C:1>>[C:1]", "[C:1]>>[C:1", "[C:1][C:1]>>[C:1]" } do
    check("rewriting " .. text, { "--bare", "-e", "local r = rewrite [==[" .. text .. "]==]" }, { "-e:1: " })
end

-- packs, with file and line
local packs = {
    { "pack { name = 'x', nmae = 1 }", "unknown field 'nmae'; did you mean 'name'?" },
    { "pack { }", "'name' is missing" },
    { "pack 'x'", "a table is expected" },
    { "\nlocal x = = 1", ":2: " },
    { "error 'boo'", "boo" },
    { "while true do end", "limit of instructions" },
    { "undefined_word { }", "undefined_word" },
    { "io.open 'x'", "global 'io'" },
    { "synthon 'a' { kind = 'giver', equivalents = {} }", "\"donor\" or \"acceptor\"" },
    { "synthon 'a' { kind = 'donor', equivalents = { { attach = 'C(' } } }", "a: " },
    { "interconversion 'a' { target = '[C:1', from = '[C:1]' }", "^" },
    { "interconversion 'a' { target = '[C:1]', from = '[C:1]=[O:2' }", "^" },
    { "interconversion 'a' { target = '[C:1]' }", "'from' is missing" },
    { "disconnection 'a' { target = '[C:1][C:2]', cut = { 1, 2 }, acceptor = { 1, 'nobody' }, donor = { 2, 'nobody' } }", "nobody" },
    { "disconnection 'a' { target = '[C:1][C:2]', cut = { 1 }, acceptor = { 1, 'x' }, donor = { 2, 'x' } }", "'cut' must be" },
    { "interconversion 'a' { target = '[C:1]', from = '[C:1]', yield = 'good' }", "'yield' must be" },
    { "interconversion 'a' { target = '[C:1]', from = '[C:1]', conditons = 'x' }", "did you mean 'conditions'?" },
    { "use '../x'", "is no name of a pack" },
}
for _, case in ipairs(packs) do
    local path = file(case[1])
    check("pack " .. case[1], { "--bare", "-l", path }, { case[2], path .. ":" })
    check("check " .. case[1], { "--bare", "check", path }, { case[2], path .. ":" })
    os.remove(path)
end
local binary = file "\27Lua\0\0"
check("binary pack", { "--bare", "-l", binary }, { "this is no text" })
os.remove(binary)
check("folder as pack", { "--bare", "-l", "/tmp/" }, { "no pack" })
check("no such pack", { "--bare", "-l", "no-such-pack" }, { "no pack 'no-such-pack'" })
check("device as pack", { "--bare", "-l", "/dev/zero" }, { "no pack" })

-- catalogues
local lists = {
    { "name\tprice\nx\t1\n", "smiles" },
    { "", "" },
    { "smiles\tname\nCCO\t\"open\n", "" , ".csv" },
}
for _, case in ipairs(lists) do
    local path = file(case[1], case[3] or ".tsv")
    if case[1] ~= lists[3][1] then
        check("catalogue " .. case[1], { "--bare", "catalogue", "build", path, "-o", path .. ".catalogue" }, { case[2] })
    end
    os.remove(path)
    os.remove(path .. ".catalogue")
end
local list = file("smiles\nCCO\n", ".tsv")
check("no such list", { "--bare", "catalogue", "build", list .. ".none", "-o", list .. ".catalogue" }, { ".none" })
check("no such folder", { "--bare", "catalogue", "build", list, "-o", "/no/such/folder/x.catalogue" }, {})
check("list as catalogue", { "--bare", "plan", "CCO", "-c", list }, {})
check("no such catalogue", { "--bare", "plan", "CCO", "-c", list .. ".none" }, { ".none" })
check("folder as catalogue", { "--bare", "plan", "CCO", "-c", "/tmp" }, {})
check("list without type", { "--bare", "catalogue", "build", "/dev/null", "-o", list .. ".catalogue" }, {})
os.remove(list)

-- scripts
local scripts = {
    { "x = = 1", ":1: unexpected symbol" },
    { "local x = nil\nx.y = 1", ":2: attempt to index a nil value" },
    { "error 'boo'", ":1: boo" },
    { "error { code = 7 }", "the error is no text but a table" },
    { "mol(12)", ":1: mol: argument 1: molecule or SMILES expected, got number" },
    { "mol 'CCO':frob()", ":1: attempt to call a nil value" },
    { "mol 'CCO':has '[C'", ":1: " },
    { "plan { target = 'CCO', limits = { depth = 'deep' } }", "'depth' must be" },
    { "\27Lua", "" },
}
for _, case in ipairs(scripts) do
    local path = file(case[1])
    check("script " .. case[1], { "--bare", path }, { case[2] })
    os.remove(path)
end
check("no such script", { "--bare", "/no/such/script.lua" }, { "/no/such/script.lua" })
check("folder as script", { "--bare", "/tmp" }, { "/tmp" })
check("plan of nonsense", { "--bare", "plan", "C(C" }, { "^" })
check("endless recursion", { "--bare", "-e", "local function f() return 1 + f() end f()" }, { "stack overflow" })

program.finish()
