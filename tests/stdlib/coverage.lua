-- Measures the standard packs against the coverage table: 771 transforms written from knowledge of the field, with an
-- example and a counterexample each (tests/data/coverage, see tests/rule/test_coverage.c).
-- Usage: backsaw coverage.lua TABLE.tsv.gz LEAST [PACK...]
--
-- A row is covered if
-- (a) some rule makes its product from exactly its precursors, each compared once, by canonical structure. Compounds
--     without carbon are left out on both sides, except ammonia, hydroxylamine and hydrazine; salts count as the
--     neutral compounds of their ions.
-- (b) the rule that answers to its name refuses its counterexample, unless that is one for another row or reagent only.

local path, least = arg[1], tonumber(arg[2])
if not path or not least then
    io.stderr:write("usage: backsaw coverage.lua TABLE.tsv.gz LEAST [PACK...]\n")
    os.exit(2)
end
local chosen, any_chosen = {}, arg[3] ~= nil
for i = 3, #arg do chosen[arg[i]] = true end

-- Rows whose counterexample their rule may take, each with the reason.
local taken = {
}

local kept_without_carbon = {}
for _, smiles in ipairs { "N", "NO", "NN" } do kept_without_carbon[mol(smiles):smiles()] = true end
local carbon = pattern "[#6]"
local deprotonate, protonate = rewrite "[+;!H0:1]>>[+0:1]", rewrite "[-:1]>>[+0:1]"

-- A charged piece with its charge taken away, where a proton does it.
local function neutral(piece)
    for _ = 1, 4 do
        local charge = piece:charge()
        if charge == 0 then break end
        local outcomes = (charge > 0 and deprotonate or protonate):apply(piece)
        if #outcomes == 0 then break end
        piece = outcomes[1][1]
    end
    return piece
end

-- The compounds that count, as one line.
local function key(precursors)
    local seen, names = {}, {}
    for _, m in ipairs(precursors) do
        for _, piece in ipairs(m:fragments()) do
            local name = neutral(piece):smiles()
            if (piece:has(carbon) or kept_without_carbon[name]) and not seen[name] then
                seen[name] = true
                names[#names + 1] = name
            end
        end
    end
    table.sort(names)
    return table.concat(names, " + ")
end

local function gives_example(row)
    local wanted = key { mol(row.precursors) }
    for _, step in ipairs(back(mol(row.product))) do
        if key(step.precursors) == wanted then return true end
    end
    return false
end

-- nil if the row is covered, else the reason.
local function fault(row)
    local known, rule = pcall(transform, row.id)
    local example = gives_example(row)
    if not known then
        return "no rule of this name" .. (example and ", though another makes the example" or "")
    end
    if not example then
        return string.format("%s is not made from %s (%d steps by the rule)", row.product, row.precursors,
            #rule:back(mol(row.product)))
    end
    if row.refused == "-" or taken[row.id] then return nil end
    local steps = rule:back(mol(row.refused))
    if #steps == 0 then return nil end
    return string.format("takes the counterexample %s (%s) from %s", row.refused, row.why, key(steps[1].precursors))
end

local function rows_of(file)
    local input, rows = assert(io.popen("gzip -dc '" .. file .. "'")), {}
    input:read "l"
    for line in input:lines() do
        local f = {}
        for field in (line .. "\t"):gmatch "([^\t]*)\t" do f[#f + 1] = field end
        rows[#rows + 1] = { id = f[1], product = f[5], precursors = f[6], refused = f[7], why = f[8], pack = f[9] }
    end
    assert(input:close(), "the table cannot be read")
    return rows
end

local packs, of_pack, covered, tried = {}, {}, 0, 0
for _, row in ipairs(rows_of(path)) do
    if not any_chosen or chosen[row.pack] then
        local count = of_pack[row.pack]
        if not count then
            count = { covered = 0, rows = 0 }
            of_pack[row.pack], packs[#packs + 1] = count, row.pack
        end
        local reason = fault(row)
        count.rows, tried = count.rows + 1, tried + 1
        if reason then
            print(string.format("%s: %s: %s", row.pack, row.id, reason))
        else
            count.covered, covered = count.covered + 1, covered + 1
        end
    end
end
for _, name in ipairs(packs) do
    print(string.format("%-18s %3d of %3d rows", name, of_pack[name].covered, of_pack[name].rows))
end
print(string.format("%d of %d rows covered", covered, tried))
if covered < least then
    io.stderr:write(string.format("expected at least %d\n", least))
    os.exit(1)
end
