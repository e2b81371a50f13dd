-- usage: backsaw compatibility.lua FILE
-- 80 bench decisions: does every group elsewhere in the molecule survive the conditions? The file names its sources
-- (textbooks, from memory) and was worked out with a reference toolkit. Compared are the verdict and, where it is a
-- clash, that the atoms of each group named are among those attacked, and that nothing else is.
local file = assert(io.open(arg[1]))

local function atoms_of(text)
    local list = {}
    for number in text:gmatch "%d+" do list[#list + 1] = math.tointeger(tonumber(number)) end
    return list
end

local function marks(lists)
    local set = {}
    for _, list in ipairs(lists) do
        for _, atom in ipairs(list) do set[atom] = true end
    end
    local sorted = {}
    for atom in pairs(set) do sorted[#sorted + 1] = atom end
    table.sort(sorted)
    return table.concat(sorted, " ")
end

local cases, good = 0, 0
for line in file:lines() do
    local id, smiles, class = line:match '"id": "([^"]*)", "molecule": "([^"]*)", "condition": "([^"]*)"'
    if id then
        smiles = smiles:gsub("\\\\", "\\")
        local reacting = atoms_of(line:match '"reacting": %[([^%]]*)%]')
        local wanted = line:match '"verdict": "(%a+)"'
        local attacked = {}
        for list in line:match('"attacked": %[(.*)%], "why"'):gmatch '"atoms": %[([^%]]*)%]' do
            attacked[#attacked + 1] = atoms_of(list)
        end
        local found = {}
        for i, clash in ipairs((mol(smiles):clashes(class, { reacting = reacting }))) do
            assert(clash.verdict == "attacked")
            found[i] = clash.atoms
        end
        local verdict = #found > 0 and "clash" or "fine"
        cases = cases + 1
        if verdict == wanted and marks(found) == marks(attacked) then
            good = good + 1
        else
            io.stderr:write(string.format("%s: %s under %s: %s at %s, not %s at %s\n", id, smiles, class, verdict,
                marks(found), wanted, marks(attacked)))
        end
    end
end
file:close()
print(string.format("%d of %d bench decisions", good, cases))
os.exit(cases == 80 and good == cases, true)
