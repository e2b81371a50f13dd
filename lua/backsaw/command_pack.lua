-- backsaw pack list|show|new|hash|diff|pages: what packs there are, what is in them, and what changed.
local core = ...
local check = core.module "check"
local study = core.module "study"
local compare = core.module "packdiff"
local skeleton = core.module "skeleton"
local page = core.module "packpage"

local usage = [[
usage: backsaw pack list
       backsaw pack show PACK
       backsaw pack new NAME [FILE]
       backsaw pack hash PACK...
       backsaw pack diff OLD NEW
       backsaw pack pages FOLDER

A PACK is a file, or a name on the path: beside the script, in the folders of BACKSAW_PATH, in the
standard library.

  list   the packs on the path: name, version, numbers of transforms, groups and synthons, file
  show   a table of the rules of a pack
  new    a commented skeleton to start from, on standard output or in a new FILE
  hash   the SHA-256 of the text of each pack, and its file
  diff   what changed from one version to another: rules that came, went, or do something else
  pages  a page in Markdown for each pack of the standard library, and README.md, into a folder

Exit status: 0 done (diff: no difference), 1 failed (diff: they differ), 2 wrong usage.]]

local function folder_of(path) return string.match(path, "^(.*)/[^/]*$") or "." end

local function is_file(path) return (core.pack_text(path)) ~= nil end

-- The file of a pack.
local function find(name)
    if string.find(name, "/", 1, true) or string.find(name, "%.lua$") then
        if is_file(name) then return name end
        core.fail("file error", string.format("no pack in file '%s'", name))
    end
    for _, folder in ipairs((core.places())) do
        local path = folder .. "/" .. name .. ".lua"
        if is_file(path) then return path end
    end
    core.fail("not found", string.format("no pack '%s' on BACKSAW_PATH or in the standard library",
        name))
end

local function inspect(path)
    return core.inspect(string.find(path, "/", 1, true) and path or "./" .. path, folder_of(path))
end

-- Rows as columns of equal width; the last is as long as it likes.
local function print_table(rows)
    local widths = {}
    for _, row in ipairs(rows) do
        for i, cell in ipairs(row) do
            widths[i] = math.max(widths[i] or 0, utf8.len(cell) or #cell)
        end
    end
    for _, row in ipairs(rows) do
        local cells = {}
        for i, cell in ipairs(row) do
            local pad = i < #row and widths[i] - (utf8.len(cell) or #cell) or 0
            cells[i] = cell .. string.rep(" ", pad)
        end
        print(table.concat(cells, "  "))
    end
end

local commands = {}

function commands.list()
    local rows, seen, failures = { { "name", "version", "transforms", "groups", "synthons", "file" } }, {}, {}
    for _, folder in ipairs((core.places())) do
        local files = core.folder(folder) or {}
        table.sort(files)
        for _, file in ipairs(files) do
            local path = folder .. "/" .. file
            if not seen[file] and study.is_pack((core.pack_text(path))) then
                seen[file] = true
                local ok, pack = pcall(inspect, path)
                if ok then
                    rows[#rows + 1] = { pack.name, pack.version or "-", tostring(#pack.transforms),
                        tostring(#pack.groups), tostring(#pack.synthons), path }
                else
                    failures[#failures + 1] = tostring(pack)
                end
            end
        end
    end
    print_table(rows)
    for _, failure in ipairs(failures) do io.stderr:write("backsaw: ", failure, "\n") end
    return #failures == 0 and 0 or 1
end

local function range(yield)
    if not yield then return "-" end
    if yield[1] == yield[2] then return tostring(yield[1]) .. " %" end
    return yield[1] .. "-" .. yield[2] .. " %"
end

function commands.show(name)
    local path = find(name)
    local pack = inspect(path)
    print(string.format("%s %s: %s", pack.name, pack.version or "(no version)", pack.about or "-"))
    print(string.format("%s, SHA-256 %s", path, core.sha256((core.pack_text(path)))))
    if #pack.transforms > 0 then
        local rows = { { "transform", "kind", "conditions", "yield", "tests", "source" } }
        for _, one in ipairs(pack.transforms) do
            rows[#rows + 1] = { one.name, one.cut and "cut" or one.kind == "disconnection" and "cut, from"
                or "interconversion", one.conditions or "-", range(one.yield), tostring(#one.tests),
                one.source or "-" }
        end
        print()
        print_table(rows)
    end
    for _, field in ipairs { "synthons", "groups", "conditions" } do
        local names = {}
        for i, one in ipairs(pack[field]) do names[i] = one.name end
        if #names > 0 then print("\n" .. field .. ": " .. table.concat(names, ", ")) end
    end
    return 0
end

-- Writes a file; nothing is left of one that cannot be written.
local function write_file(path, text)
    local file, problem = io.open(path, "wb")
    if not file then core.fail("file error", problem) end
    local ok = file:write(text)
    ok = file:close() and ok
    if not ok then
        os.remove(path)
        core.fail("file error", path .. ": cannot be written")
    end
end

function commands.new(name, path)
    local text = skeleton(name)
    if not path then
        io.write(text)
        return 0
    end
    local there, other = core.pack_text(path)
    if there or other then
        core.fail("file error", string.format("%s is there already; nothing was written", path))
    end
    write_file(path, text)
    return 0
end

function commands.hash(...)
    for _, name in ipairs { ... } do
        local path = find(name)
        print(core.sha256((core.pack_text(path))) .. "  " .. path)
    end
    return 0
end

function commands.diff(old, new)
    local lines = compare(inspect(find(old)), inspect(find(new)))
    for _, line in ipairs(lines) do print(line) end
    return #lines == 0 and 0 or 1
end

function commands.pages(folder)
    local _, library = core.places()
    if not library then core.fail("not found", "no standard library is found") end
    local files = core.folder(library)
    table.sort(files)
    local index = { "# The standard library\n", "| pack | rules | what |", "| --- | --- | --- |" }
    for _, file in ipairs(files) do
        local pack, name = inspect(library .. "/" .. file), string.gsub(file, "%.lua$", ".md")
        write_file(folder .. "/" .. name, page(pack))
        index[#index + 1] = string.format("| [%s](%s) | %d | %s |", pack.name, name, #pack.transforms,
            pack.about or "")
    end
    write_file(folder .. "/README.md", table.concat(index, "\n") .. "\n")
    return 0
end

-- How many arguments each takes.
local arity = { list = { 0, 0 }, show = { 1, 1 }, new = { 1, 2 }, hash = { 1, math.huge }, diff = { 2, 2 },
    pages = { 1, 1 } }
local order = { "list", "show", "new", "hash", "diff", "pages" }

local function wrong(...)
    io.stderr:write("backsaw pack: ", string.format(...), "\n",
        "usage: backsaw pack list|show|new|hash|diff|pages ... (--help tells more)\n")
    return 2
end

local function main(command, ...)
    local arguments = { ... }
    for _, argument in ipairs { command, ... } do
        if argument == "--help" then
            print(usage)
            return 0
        end
    end
    if not command then return wrong("one of list, show, new, hash, diff, pages is expected") end
    if not commands[command] then
        return wrong("unknown command '%s'%s", command, check.meant(command, order))
    end
    for _, argument in ipairs(arguments) do
        if string.sub(argument, 1, 1) == "-" then return wrong("unknown option '%s'", argument) end
    end
    if #arguments < arity[command][1] or #arguments > arity[command][2] then
        return wrong("%s: %s expected", command, command == "list" and "no argument is"
            or command == "diff" and "two packs are" or command == "new" and "a name, and perhaps a file, is"
            or command == "pages" and "a folder is"
            or "a pack is")
    end
    return commands[command](...)
end

return main
