-- Drafts a transform from every nth row of the coverage table (tests/data/coverage, see tests/rule/test_coverage.c) and
-- tests each apart from what the draft says of itself: the text loads, its own check passes, backwards it makes the
-- row's precursors, and forwards the row's product.
-- Usage: backsaw draft.lua TABLE.tsv.gz EVERY LEAST [SHOW]

local path, every, least, show = arg[1], tonumber(arg[2]), tonumber(arg[3]), arg[4]
if not path or not every or not least then
    io.stderr:write("usage: backsaw draft.lua TABLE.tsv.gz EVERY LEAST [SHOW]\n")
    os.exit(2)
end

-- Pieces of all molecules, each once, in one order: how a text groups ions into compounds makes no difference.
local function pieces(molecules)
    local seen, names = {}, {}
    for _, m in ipairs(molecules) do
        for _, piece in ipairs(m:fragments()) do
            local name = piece:smiles()
            if not seen[name] then
                seen[name] = true
                names[#names + 1] = name
            end
        end
    end
    table.sort(names)
    return table.concat(names, " + ")
end

-- Whether a forward run gives the product; a rule without marks may leave new centres open.
local function gives(rule, reactants, product)
    for _, set in ipairs(rule:forth(table.unpack(reactants))) do
        for _, m in ipairs(set.products) do
            if set.expected and m:smiles "plain" == product:smiles "plain" then return true end
        end
    end
    return false
end

-- nil, or what is wrong with the draft of a row.
local function fault(row)
    local ok, text = pcall(draft, row.precursors .. ">>" .. row.product, { name = "draft of " .. row.id })
    if not ok then return tostring(text) end
    if show then print(text) end
    local chunk, why = load("return " .. text)
    if not chunk then return why end
    local loaded, rule = pcall(chunk)
    if not loaded then return tostring(rule) .. "\n" .. text end
    local passed, failures = rule:check()
    if not passed then return failures[1] .. "\n" .. text end
    local product, found = mol(row.product), false
    for _, step in ipairs(rule:back(product)) do
        found = found or pieces(step.precursors) == pieces { mol(row.precursors) }
    end
    if not found then return "backwards it gives something else\n" .. text end
    local reactants = {}
    for smiles in text:match("from = (%b{})"):gmatch '"([^"]*)"' do
        reactants[#reactants + 1] = mol((smiles:gsub("\\\\", "\\")))
    end
    if not gives(rule, reactants, product) then return "forwards it gives something else\n" .. text end
end

local input, number, tried, good = assert(io.popen("gzip -dc '" .. path .. "'")), 0, 0, 0
input:read "l"
for line in input:lines() do
    local f = {}
    for field in (line .. "\t"):gmatch "([^\t]*)\t" do f[#f + 1] = field end
    if number % every == 0 then
        local reason = fault { id = f[1], product = f[5], precursors = f[6] }
        tried = tried + 1
        if reason then
            print(f[1] .. ": " .. f[6] .. ">>" .. f[5] .. ": " .. reason)
        else
            good = good + 1
        end
    end
    number = number + 1
end
assert(input:close(), "the table cannot be read")
print(string.format("%d of %d drafts give their example back", good, tried))
if good < least then
    io.stderr:write(string.format("expected at least %d\n", least))
    os.exit(1)
end
