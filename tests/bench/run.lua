-- usage: backsaw run.lua MOLECULES.smi [AT_MOST [SMARTS.txt [REACTIONS.txt]]]
-- Times the work of the molecule layer and of rewriting, called from a script. Prints lines of
-- task, items, seconds, items per second, separated by tabs, and lines of counts that begin with
-- "# ". Seconds are CPU time of the process, which has one thread here.
--
--   read     SMILES to a perceived molecule                              items: molecules
--   write    canonical SMILES of molecules that were just read           items: molecules
--   match    `has` of each pattern                                       items: molecule x pattern
--   rewrite  each template: products perceived and named, no duplicates  items: molecule x template
--   expand   `back` of all transforms in use, forward checks included    items: molecules
local here = arg[0]:match "^(.*)/" or "."
local data = here .. "/../data/bench/"

-- The first words of the lines of a file; a line that begins with "# " is a remark.
local function words(path, most)
    local list = {}
    for line in io.lines(path) do
        local word = line:match "^%S+"
        if #list == most then break end
        if word and word ~= "#" then list[#list + 1] = word end
    end
    return list
end

local path = assert(arg[1], "usage: run.lua MOLECULES.smi [AT_MOST [SMARTS [REACTIONS]]]")
local most = tonumber(arg[2] or "0")
local texts = words(path, most > 0 and most or nil)
local patterns = words(arg[3] or data .. "smarts.txt")
local templates = words(arg[4] or data .. "reactions.txt")

local function time(task, count, work)
    collectgarbage()
    local start = os.clock()
    work()
    local seconds = os.clock() - start
    print(string.format("%s\t%d\t%.4f\t%.1f", task, count, seconds, count / seconds))
end

for i, text in ipairs(patterns) do patterns[i] = pattern(text) end
for i, text in ipairs(templates) do templates[i] = rewrite(text) end
print "task\titems\tseconds\titems_per_second"

local mols = table.move(texts, 1, #texts, 1, {})
collectgarbage()
local before = collectgarbage "count"
time("read", #texts, function()
    for i, text in ipairs(texts) do mols[i] = mol(text) end
end)
collectgarbage()
local bytes_each = (collectgarbage "count" - before) * 1024 / #mols

local bytes = 0
time("write", #mols, function()
    for _, m in ipairs(mols) do bytes = bytes + #m:smiles() end
end)

local hits = 0
time("match", #mols * #patterns, function()
    for _, m in ipairs(mols) do
        for _, p in ipairs(patterns) do
            if m:has(p) then hits = hits + 1 end
        end
    end
end)

local sets = 0
time("rewrite", #mols * #templates, function()
    for _, m in ipairs(mols) do
        for _, t in ipairs(templates) do sets = sets + #t:apply(m) end
    end
end)

local steps = 0
time("expand", #mols, function()
    for _, m in ipairs(mols) do steps = steps + #back(m) end
end)

print(string.format("# molecules %d, bytes written %d, hits %d, product sets %d", #mols, bytes, hits,
    sets))
print(string.format("# steps %d, bytes a molecule %.0f", steps, bytes_each))
