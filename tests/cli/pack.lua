-- backsaw pack: list, show, new, hash, diff. Packs are written here and compared with what the
-- program says of them; the hash with sha256sum of GNU coreutils.
local program = dofile(os.getenv "BACKSAW_CLI" .. "/program.lua")
local run, expect = program.run, program.expect

local function check(arguments, status, finds, lacks, complaint)
    local result = run(arguments)
    expect("status " .. status, result, result.status == status)
    for _, text in ipairs(finds or {}) do expect(text, result, result.out:find(text, 1, true)) end
    for _, text in ipairs(lacks or {}) do expect("without " .. text, result, not result.out:find(text, 1, true)) end
    expect("error " .. tostring(complaint), result, complaint and result.err:find(complaint, 1, true)
        or not complaint and result.err == "")
    return result
end

local folder = os.tmpname()
os.remove(folder)
assert(os.execute("mkdir '" .. folder .. "'"))
local function put(name, text)
    local path = folder .. "/" .. name
    local f = assert(io.open(path, "wb"))
    f:write(text)
    f:close()
    return path
end

-- wrong usage
check({ "pack" }, 2, nil, nil, "one of list, show, new, hash, diff, pages is expected")
check({ "pack", "hsah" }, 2, nil, nil, "unknown command 'hsah'; did you mean 'hash'?")
check({ "pack", "show" }, 2, nil, nil, "a pack is expected")
check({ "pack", "diff", "x" }, 2, nil, nil, "two packs are expected")
check({ "pack", "list", "x" }, 2, nil, nil, "no argument is expected")
check({ "pack", "show", "--all" }, 2, nil, nil, "unknown option '--all'")
check({ "pack", "show", "no-such-pack" }, 1, nil, nil, "no pack 'no-such-pack'")
check({ "pack", "hash", folder .. "/none.lua" }, 1, nil, nil, "no pack in file")

-- list and show: BACKSAW_PATH has the packs of the tests, the standard library comes behind
check({ "pack", "list" }, 0, { "quay ", "quay-base ", "cross-coupling ", "synthons " })
check({ "pack", "show", "quay" }, 0, { "quay 0.1.0: For the tests", "quay ether", "80-95 %" })
check({ "pack", "show", "quay-base" }, 0, { "synthons: quay " })

-- a skeleton loads and passes as it is; a file that is there stays
local text = check({ "pack", "new", "north-pier" }, 0, { 'name = "north-pier"' }, { "NAME" }).out
local path = folder .. "/north-pier.lua"
check({ "pack", "new", "north-pier", path }, 0)
check({ "check", "--strict", path }, 0, { "north-pier: 2 transforms, 4 self-tests, 0 failed" })
check({ "pack", "new", "other", path }, 1, nil, nil, "is there already; nothing was written")
local f = assert(io.open(path, "rb"))
local result = { command = "pack new", status = 0, out = f:read "a", err = "" }
f:close()
expect("the file holds the skeleton", result, result.out == text)
check({ "pack", "new", "../x" }, 1, nil, nil, "is no name of a pack")
check({ "pack", "new", "x", folder .. "/no/x.lua" }, 1, nil, nil, "No such file")

-- hash
local hash = run { "pack", "hash", path }
local pipe = assert(io.popen("sha256sum '" .. path .. "'"))
expect("as sha256sum says", hash, hash.out == pipe:read "a")
pipe:close()

-- diff: nothing, then one change of each kind
local rules = [[
interconversion "old way" { target = "[CX3:1]=[OX1:2]", from = "[C:1]([OX2H:2])" }
interconversion "gone" { target = "[CX4:1]F", from = "[C:1]Cl" }
interconversion "kept" { target = "[CX4:1]Br", from = "[C:1]O", yield = { 50, 70 }, recipe = "HBr",
    example { "CBr", from = { "CO" } }, refuse { "CCl" } }
synthon "half" { kind = "donor", equivalents = { "[Na]" } }
]]
local old = put("old.lua", 'pack { name = "tide", version = "1.0.0" }\n' .. rules)
check({ "pack", "diff", old, old }, 0, nil, { "changed" })
local new = put("new.lua", 'pack { name = "tide", version = "1.1.0" }\n' .. rules:gsub('"old way"', '"new way"')
    :gsub("interconversion \"gone\"[^\n]*", 'interconversion "came" { target = "[CX4:1]I", from = "[C:1]Cl" }')
    :gsub("{ 50, 70 }", "{ 60, 70 }"):gsub('"HBr"', '"PBr3"'):gsub("%[CX4:1%]Br", "[CX4;H2,H3:1]Br")
    :gsub('refuse { "CCl" }', 'refuse { "CC(C)Br" }'):gsub('{ "%[Na%]" }', '{ "[Na]", "[Li]" }'))
check({ "pack", "diff", old, new }, 1, { "version: 1.0.0 -> 1.1.0", "renamed: old way", "  name: old way -> new way",
    "removed: gone ([CX4:1]F>>[C:1]Cl)", "added: came ([CX4:1]I>>[C:1]Cl)", "changed: kept",
    "  target: [CX4:1]Br -> [CX4;H2,H3:1]Br", "  yield: 50-70 % -> 60-70 %", "  recipe: HBr -> PBr3",
    "  - refuse CCl", "  + refuse CC(C)Br", "changed: synthon half: donor, [Na] -> donor, [Na] [Li]" },
    { "example", "from:" })

-- pages: one a pack, with what the pack says
check({ "pack", "pages", folder .. "/none" }, 1, nil, nil, "No such file")
assert(os.execute("mkdir '" .. folder .. "/pages'"))
check({ "pack", "pages", folder .. "/pages" }, 0)
local function page_has(name, wanted)
    local page = assert(io.open(folder .. "/pages/" .. name))
    local content = page:read "a"
    page:close()
    expect(name .. ": " .. wanted, { command = "pack pages", status = 0, out = content:sub(1, 500), err = "" },
        content:find(wanted, 1, true))
end
page_has("README.md", "[cross-coupling](cross-coupling.md)")
page_has("cross-coupling.md", "### suzuki-biaryl")
page_has("cross-coupling.md", "acceptor at 1: aryl-halide; donor at 2: organoboron")
page_has("cross-coupling.md", "- refuses: `c1ccc(-c2ccccn2)nc1`")
page_has("synthons.md", "- **acyl**: acceptor; Cl")

-- a pack that cannot be read says why
check({ "pack", "show", put("bad.lua", 'pack { name = "bad" }\nsynthon "x" {}\n') }, 1, nil, nil, "bad.lua:2: synthon")
check({ "pack", "show", put("loop.lua", "while true do end") }, 1, nil, nil, "limit")

-- docs/packs.md followed literally: the first block of Lua goes into a file, which loads, passes the
-- strict check, and plans
local guide = assert(io.open(os.getenv "BACKSAW_CLI" .. "/../../docs/packs.md"))
local block = guide:read("a"):match "\n```lua\n(pack {.-)\n```\n"
guide:close()
path = put("quayside.lua", block)
check({ "check", "--strict", path }, 0, { "quayside: 2 transforms, 5 self-tests, 0 failed" }, { "warning" })
local list = put("shelf.tsv", "smiles\tname\nOCc1ccc(F)cc1\talcohol\n[Na+].[C-]#N\tcyanide\n")
check({ "catalogue", "build", list, "-o", folder .. "/shelf" }, 0)
result = run { "--bare", "-l", path, "plan", "N#CCc1ccc(F)cc1", "-c", folder .. "/shelf", "--quiet" }
expect("plans", result, result.status == 0 and result.out:find("quayside benzyl cyanide", 1, true)
    and result.out:find("quayside benzyl chloride", 1, true))

-- what is no regular file is no pack: nothing waits for it
assert(os.execute("mkfifo '" .. folder .. "/pipe.lua'"))
check({ "pack", "hash", folder .. "/pipe.lua" }, 1, nil, nil, "no pack in file")
check({ "pack", "new", "x", folder .. "/quayside.lua" }, 1, nil, nil, "is there already")
check({ "pack", "new", "x", folder .. "/pipe.lua" }, 1, nil, nil, "is there already")
check({ "check", folder .. "/pipe.lua" }, 1, { "no pack in file" })
os.execute("rm -r '" .. folder .. "'")

program.finish()
