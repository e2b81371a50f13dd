-- Samples the steps that the standard packs propose without a clash, for a chemist to judge: would this work as drawn?
-- Usage: backsaw sample.lua MOLECULES COUNT SEED
--
-- Prints COUNT steps, one a line: product, precursors, transform, conditions, separated by tabs; then the number of steps
-- that they were drawn from. The molecules are 300 drug-like ones of the file (SMILES, tab, id), evenly spaced: carbon
-- compounds of 12 to 40 heavy atoms in one piece, of common elements, without charges but for nitro groups and the like,
-- with a ring. The same file, COUNT and SEED give the same lines.

local path, count, seed = arg[1], math.tointeger(tonumber(arg[2])), math.tointeger(tonumber(arg[3]))
if not path or not count or not seed then
    io.stderr:write("usage: backsaw sample.lua MOLECULES COUNT SEED\n")
    os.exit(2)
end
local MOLECULES = 300

-- Fragments, metals, radicals and the oddities of a set that tests readers are nothing to make.
local ring, odd = pattern "[R]", pattern "[!#6;!#7;!#8;!#16;!#15;!F;!Cl;!Br;!I;!#1]"
local charged, oxide = pattern "[+,-]", pattern "[+]~[-]"
local function drug_like(m)
    local size = #m:atoms()
    return size >= 12 and size <= 40 and #m:doubts() == 0 and #m:fragments() == 1 and m:charge() == 0
        and m:has(ring) and not m:has(odd) and m:count(charged) == 2 * m:count(oxide)
end

local function molecules_of(file)
    local input, list = assert(io.popen("gzip -dc '" .. file .. "'")), {}
    for line in input:lines() do
        local smiles, id = line:match "^(%S+)\t(%S+)$"
        -- The ring systems of the file are cut out of molecules, and hardly ever compounds in themselves.
        if smiles and not id:find "^ring" and not id:find "^own" then
            local m = mol(smiles)
            if drug_like(m) then list[#list + 1] = m end
        end
    end
    assert(input:close(), "the molecules cannot be read")
    local chosen = {}
    for i = 1, math.min(MOLECULES, #list) do
        chosen[i] = list[1 + (i - 1) * #list // math.min(MOLECULES, #list)]
    end
    return chosen
end

-- xorshift64*: Marsaglia 2003 and Vigna 2016, from memory.
local state = seed * 2654435761 + 88172645463325252
local function random(below)
    state = state ~ (state >> 12)
    state = state ~ (state << 25)
    state = state ~ (state >> 27)
    return (state * 2685821657736338717 >> 33) % below
end

local function names(list)
    local texts = {}
    for i, m in ipairs(list) do texts[i] = m:smiles() end
    return table.concat(texts, " + ")
end

local steps = {}
for _, m in ipairs(molecules_of(path)) do
    for _, step in ipairs(back(m)) do
        if #step.clashes == 0 and not step.minor then
            steps[#steps + 1] = table.concat({ m:smiles(), names(step.precursors), step.transform,
                step.recipe or step.conditions or "-" }, "\t")
        end
    end
end

local total = #steps
for _ = 1, math.min(count, total) do
    local i = 1 + random(#steps)
    print(steps[i])
    steps[i] = steps[#steps]
    steps[#steps] = nil
end
print(string.format("%d steps in all", total))
