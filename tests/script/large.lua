-- Large and highly symmetrical molecules: read, named, and the name read again names the same. A molecule
-- whose atoms come in another order has the same name.
local function same_again(m)
    local name = m:smiles()
    return mol(name):smiles() == name
end

local chain = mol(("C"):rep(100000))
print(#chain:atoms(), same_again(chain)) --> 100000	true
local nested = mol(("C("):rep(10000) .. "C" .. (")"):rep(10000))
print(#nested:atoms(), same_again(nested)) --> 10001	true
local ring = mol("C1" .. ("C"):rep(19998) .. "1")
print(#ring:atoms(), same_again(ring)) --> 19999	true

local function dendrimer(depth)
    if depth == 0 then return "O" end
    local branch = dendrimer(depth - 1)
    return ("C(%s)(%s)%s"):format(branch, branch, branch)
end
local tree = mol("C" .. dendrimer(7))
print(#tree:atoms(), same_again(tree)) --> 3281	true

local residues = { "[C@@H](C)", "C", "[C@@H](C(C)C)", "[C@@H](Cc1ccccc1)", "[C@@H](CO)", "[C@@H](CCCCN)" }
local peptide = {}
for i = 1, 100 do peptide[i] = "N" .. residues[(i * 7 + i // 3) % 6 + 1] .. "C(=O)" end
local chain_of_residues = mol(table.concat(peptide) .. "O")
print(same_again(chain_of_residues)) --> true
local dodecahedrane = mol "C12C3C4C5C1C6C7C2C8C3C9C4C1C5C6C2C7C8C9C12"
print(dodecahedrane:formula(), same_again(dodecahedrane)) --> C20H20	true

-- Fullerene cages with hydrogen at each atom, as the dual of an icosahedron whose faces are cut into
-- h * h triangles (M. Goldberg, Tohoku Math. J. 1937, 43, 104, from memory): 20 h * h atoms.
local phi = (1 + math.sqrt(5)) / 2
local corners = {}
for _, a in ipairs { 1, -1 } do
    for _, b in ipairs { phi, -phi } do
        table.insert(corners, { 0, a, b })
        table.insert(corners, { a, b, 0 })
        table.insert(corners, { b, 0, a })
    end
end

local function near(a, b)
    local sum = 0
    for k = 1, 3 do sum = sum + (a[k] - b[k]) ^ 2 end
    return math.abs(sum - 4) < 1e-6
end

local function triangles(h)
    local list = {}
    local function point(a, b, c, i, j)
        local text = {}
        for k = 1, 3 do
            local x = a[k] + (b[k] - a[k]) * i / h + (c[k] - a[k]) * j / h
            text[k] = ("%.4f"):format(math.abs(x) < 1e-9 and 0 or x)
        end
        return table.concat(text, " ")
    end
    local function face(a, b, c)
        for i = 0, h - 1 do
            for j = 0, h - 1 - i do
                local p, q = point(a, b, c, i + 1, j), point(a, b, c, i, j + 1)
                list[#list + 1] = { point(a, b, c, i, j), p, q }
                if i + j < h - 1 then list[#list + 1] = { p, point(a, b, c, i + 1, j + 1), q } end
            end
        end
    end
    for i = 1, 12 do
        for j = i + 1, 12 do
            for k = j + 1, 12 do
                local a, b, c = corners[i], corners[j], corners[k]
                if near(a, b) and near(b, c) and near(a, c) then face(a, b, c) end
            end
        end
    end
    return list
end

-- Bonds between triangles that share an edge.
local function cage(h)
    local list, at, bonds = triangles(h), {}, {}
    for n, t in ipairs(list) do
        table.sort(t)
        for _, edge in ipairs { t[1] .. "|" .. t[2], t[1] .. "|" .. t[3], t[2] .. "|" .. t[3] } do
            if at[edge] then bonds[#bonds + 1] = { at[edge], n } else at[edge] = n end
        end
    end
    return #list, bonds
end

local function read_cage(count, bonds, order)
    local path = os.tmpname()
    os.remove(path)
    path = path .. ".mol"
    local file = assert(io.open(path, "w"))
    file:write("\n\n\n  0  0  0     0  0            999 V3000\nM  V30 BEGIN CTAB\n")
    file:write(("M  V30 COUNTS %d %d 0 0 0\nM  V30 BEGIN ATOM\n"):format(count, #bonds))
    for i = 1, count do file:write(("M  V30 %d C 0 0 0 0\n"):format(i)) end
    file:write("M  V30 END ATOM\nM  V30 BEGIN BOND\n")
    for i, bond in ipairs(bonds) do
        file:write(("M  V30 %d 1 %d %d\n"):format(i, order[bond[1]], order[bond[2]]))
    end
    file:write("M  V30 END BOND\nM  V30 END CTAB\nM  END\n")
    file:close()
    local m = mol.read(path)[1]
    os.remove(path)
    return m
end

local function orders(count)
    local plain, mixed, seed = {}, {}, 1
    for i = 1, count do plain[i], mixed[i] = i, i end
    for i = count, 2, -1 do
        seed = (seed * 1103515245 + 12345) % 2147483648
        local k = seed % i + 1
        mixed[i], mixed[k] = mixed[k], mixed[i]
    end
    return plain, mixed
end

for _, h in ipairs { 1, 3, 5, 6 } do
    local count, bonds = cage(h)
    local plain, mixed = orders(count)
    local m = read_cage(count, bonds, plain)
    print(m:formula(), #m:rings(), same_again(m), m == read_cage(count, bonds, mixed))
end
--> C20H20	11	true	true
--> C180H180	91	true	true
--> C500H500	251	true	true
--> C720H720	361	true	true
print(read_cage(20, select(2, cage(1)), (orders(20))) == dodecahedrane) --> true
