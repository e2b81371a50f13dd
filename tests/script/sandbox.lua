-- Packs: by name and by file, and what they cannot do.
use "quay"
use "quay"
local rule = transform "quay ether"
print(rule.pack, (rule:check())) --> quay	true
print(#rule:back(mol "CCOc1ccccc1"), #rule:back(mol "CC(C)Oc1ccccc1")) --> 1	0

-- Writes a pack, uses it, and gives the message without the name of the file.
local count = 0
local function try(text)
    count = count + 1
    local path = os.tmpname()
    os.remove(path)
    path = path .. ".lua"
    local file = assert(io.open(path, "w"))
    file:write(text)
    file:close()
    local ok, problem = pcall(use, path)
    os.remove(path)
    if ok then return "fine" end
    local text = tostring(problem):gsub(path:gsub("%p", "%%%0"), "PACK")
    return (text:gsub("\n.*", ""))
end

print(try "pack { name = 'try-1' }") --> fine
print(try "while true do end") --> PACK:1: the limit of instructions for a pack is reached
print(try "local t = {} for i = 1, 1e9 do t[i] = ('x'):rep(2^17) .. i end") --> PACK: the memory limit of 256 MiB for packs is reached
print(try "local t = 'x' while true do t = t .. t end") --> PACK: a string of more than 256 KiB in a pack

-- what the library does for a pack counts as well, in work and in memory
print(try "while true do mol(('C'):rep(1000)) end") --> PACK:1: the limit of instructions for a pack is reached
print((try "local m = mol(('C1CC1'):rep(300)) while true do m:count '*~*~*~*~*~*~*~*' end":gsub("instructions for a pack", "work"))) --> PACK:1: the limit of work is reached
print(try "local s = ('x'):rep(2^18) while true do local t = s:reverse() end") --> PACK:1: the limit of instructions for a pack is reached
print((try "local t = {} for i = 1, 1e9 do t[i] = pattern('[#6:' .. i % 900 .. ']' .. ('~*'):rep(i % 500)) end":gsub("instructions for a pack", "work"))) --> PACK:1: the limit of work is reached
print((try "for i = 1, 1e9 do synthon('s' .. i) { kind = 'donor', equivalents = { { attach = 'Cl' } } } end":gsub("instructions for a pack", "work"))) --> PACK:1: the limit of work is reached
print(try "assert(not mol('C').ideas and not mol('C').molfile)") --> fine
print(try "assert(not io and not os and not load and not pcall and not getmetatable and not debug and not require)") --> fine
print(try "assert(not coroutine and not setmetatable and not rawset and not next and not dofile and not math.random)") --> fine
print(try "assert(not ('x').gsub and not ('x').find and not string.dump and not plan and not catalogue)") --> fine
print(try "string.upper = 1 table.sort = nil math = nil x = 5") --> fine
print(try "assert(x == nil and ('a'):upper() == 'A' and table.sort and math.floor(1.5) == 1)") --> fine
print(try "use './quay.lua'") --> PACK:1: './quay.lua' is no name of a pack; letters, digits, '-', '_' and '.' are expected
print(try "pack { name = 'x', needs = { '../../etc/passwd' } }") --> PACK:1: '../../etc/passwd' is no name of a pack; letters, digits, '-', '_' and '.' are expected
print(try "mol.read '/etc/passwd'") --> PACK:1: mol.read: a pack reads no files
print(try "mol.read '/no/such/file'") --> PACK:1: mol.read: a pack reads no files
print(try "mol.each 'x.sdf'") --> PACK:1: mol.each: a pack reads no files
print(try "assert(mol('OCC') == mol 'CCO' and mol('C').molfile == nil)") --> fine
print(try "('x'):rep(1e9)") --> PACK:1: string.rep: more than 256 KiB
print(try "assert(tostring({}) == 'table' and ('%s'):format(print) == 'function')") --> fine
print(try "local s = '' for k in pairs { b = 1, a = 2, 30, 20 } do s = s .. tostring(k) end assert(s == '12ab')") --> fine
print(try "pack { name = 'quay' }") --> PACK:1: a pack named 'quay' is already in use
print(try "pack { name = 'try-2', licens = 'x' }") --> PACK:1: pack: unknown field 'licens'; did you mean 'licence'?
print(try "interconversion 'try 3' { target = '[C:1', from = '[C:1]' }":match "^PACK:1: try 3: target") --> PACK:1: try 3: target
print(try "local x = = 3":match "^PACK:1: ") --> PACK:1: 
print(try "error {}") --> PACK: the error is no text but a table
print(try "\27Lua") --> PACK: this is no text; a pack in Lua is expected
print(try "x = '\0'") --> PACK: this is no text; a pack in Lua is expected
print(fails(use, "no-such-pack")) --> no pack 'no-such-pack' beside the script, on BACKSAW_PATH or in the standard library
print(fails(use, "./no-such-pack.lua")) --> no pack in file './no-such-pack.lua'
print(fails(use, 3)) --> use: the name or the file of a pack is expected, not a number

-- a pack that fails leaves nothing, so it can be put right and tried again
local good = "interconversion 'try half' { target = '[CX4:1][OX2H:2]', from = '[C:1]Br.[O:2]' } "
print(try(good .. "error 'late'")) --> PACK:1: late
print(fails(transform, "try half")) --> no transform named 'try half'
print(try(good), #transform("try half"):back "CCO") --> fine	1
print(try(good):match "there already") --> there already

-- a function of a rule that never ends is stopped, and the session goes on
print(try "interconversion 'try endless' { target = '[CX4:1][OX2H:2]', from = '[C:1]Br.[O:2]', when = function() while true do end end }") --> fine
local endless = transform "try endless"
print((fails(endless.back, endless, mol "CCO"):gsub("^.*:%d+: ", ""))) --> the limit of instructions for a pack is reached
print(#rule:back(mol "CCOc1ccccc1")) --> 1
