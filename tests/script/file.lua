-- Files of molecules. The molfiles are written by hand after the CTfile formats.
local base = os.tmpname()
os.remove(base)
local made = {}

local function write(ending, text)
    local path = base .. ending
    local file = assert(io.open(path, "wb"))
    file:write(text)
    file:close()
    made[#made + 1] = path
    return path
end

-- A message without the folder of the file.
local function short(message)
    return (message:gsub(base:gsub("%p", "%%%0"), "FILE"))
end

local water = "water\n\n\n  1  0  0  0  0  0  0  0  0  0999 V2000\n"
    .. "    0.0000    0.0000    0.0000 O   0  0\nM  END\n"
local bad = "bad\n\n\n  1  0  0  0  0  0  0  0  0  0999 V2000\n"
    .. "    0.0000    0.0000    0.0000 Xx  0  0\nM  END\n"
local methanol = "\n\n\n  0  0  0     0  0            999 V3000\nM  V30 BEGIN CTAB\n"
    .. "M  V30 COUNTS 2 1 0 0 0\nM  V30 BEGIN ATOM\nM  V30 1 C 0 0 0 0\nM  V30 2 O 1.5 0 0 0\n"
    .. "M  V30 END ATOM\nM  V30 BEGIN BOND\nM  V30 1 1 1 2\nM  V30 END BOND\nM  V30 END CTAB\nM  END\n"

-- a racemic centre, after the collections of the CTfile formats
local racemic = "\n\n\n  0  0  0     0  0            999 V3000\nM  V30 BEGIN CTAB\n"
    .. "M  V30 COUNTS 4 3 0 0 0\nM  V30 BEGIN ATOM\nM  V30 1 C 0 0 0 0\nM  V30 2 F 0 1.5 0 0\n"
    .. "M  V30 3 Cl 1.3 -0.75 0 0\nM  V30 4 Br -1.3 -0.75 0 0\nM  V30 END ATOM\nM  V30 BEGIN BOND\n"
    .. "M  V30 1 1 1 2 CFG=1\nM  V30 2 1 1 3\nM  V30 3 1 1 4\nM  V30 END BOND\n"
    .. "M  V30 BEGIN COLLECTION\nM  V30 MDLV30/STERAC1 ATOMS=(1 1)\nM  V30 END COLLECTION\n"
    .. "M  V30 END CTAB\nM  END\n"
local halon = mol.read(write(".racemic.mol", racemic))[1]
print(halon:formula(), #halon:doubts(), halon:doubts()[1]) --> CHBrClF	1	atom 1: a mixture of both configurations in the file, as drawn here

local group = halon.stereo_groups[1]
print(#halon.stereo_groups, group.kind, group.number, group.atoms[1]) --> 1	racemic	1	1

-- writing: fields in order, the stereo group, a name of one's own
local out <const> = base .. ".out.sdf"
made[#made + 1] = out
local writer = mol.writer(out)
writer:write(halon)
writer:write(mol "C[C@H](N)C(=O)O", { name = "alanine", fields = { "CAS", CAS = "338-69-2", purity = 99, about = "an\namine" } })
print(short(select(2, pcall(io.lines, out)))) --> cannot open file 'FILE.out.sdf' (No such file or directory)
writer:close()
local back = mol.read(out)
print(#back, back[1] == halon, back[1].stereo_groups[1].kind, back[2].name, back[2] == mol "C[C@H](N)C(=O)O") --> 2	true	racemic	alanine	true
print(table.concat(back[2].fields, " "), back[2].fields.CAS, back[2].fields.purity, (back[2].fields.about:gsub("\n", "|"))) --> CAS about purity	338-69-2	99	an|amine
local good = {}
for _, ending in ipairs { ".a.smi", ".b.smi.gz", ".c.sdf.gz", ".d.mol" } do
    made[#made + 1] = base .. ending
    mol.write(base .. ending, back)
    local again = mol.read(base .. ending)
    good[#good + 1] = #again == 2 and again[1] == back[1] and again[2] == back[2] and again[2].name
end
print(table.concat(good, " ")) --> alanine alanine alanine alanine
print(pcall(function()
    local w <close> = mol.writer(base .. ".e.sdf")
    w:write(back[1])
    error("stopped", 0)
end)) --> false	stopped
print(short(select(2, io.open(base .. ".e.sdf")))) --> FILE.e.sdf: No such file or directory
print(short(select(2, pcall(mol.writer, base .. ".pdf")).message)) --> the name 'FILE.pdf' does not tell what to write; .sdf, .mol or .smi was expected, or one of them with .gz

-- lists of SMILES
local smi = write(".smi", "# invented\nOCC ethanol\n\nCC(=O)O acetic acid\nC\n")
local list = mol.read(smi)
print(#list, list[1] == mol "CCO", list[1].name, list[2].name, list[3].name == "") --> 3	true	ethanol	acetic acid	true
print(#list[1].fields, list[1].fields.x, list[1]:formula(), list[1].nonsense) --> 0	nil	C2H6O	nil
print(mol("CCO").name, mol("CCO").fields) --> nil	nil
local names = {}
for m in mol.each(smi) do names[#names + 1] = m.name end
print(table.concat(names, ";")) --> ethanol;acetic acid;

-- SD files: names, fields in the order of the file
local sdf = write(".sdf", water .. "> <CAS>\n7732-18-5\n\n> <note>\nfirst\nsecond\n\n> <CAS>\nnone\n\n$$$$\n"
    .. methanol .. "$$$$\n")
list = mol.read(sdf)
print(#list, list[1] == mol "O", list[2] == mol "CO", list[1].name, list[2].name == "") --> 2	true	true	water	true
local fields = list[1].fields
print(#fields, fields[1], fields[2], fields.CAS, (fields.note:gsub("\n", "|"))) --> 2	CAS	note	none	first|second
print(#mol.read(write(".mol", water)), #mol.read(write(".SD", "")), #mol.read(write(".smiles", ""))) --> 1	0	0

-- gzip: "CCO ethanol\n" in a stored block (RFC 1952), its check sum worked out by zlib
local packed = "\31\139\8\0\0\0\0\0\0\255\1\12\0\243\255CCO ethanol\n\xBA\x4A\xF4\xEF\12\0\0\0"
local gz = write(".smi.gz", packed)
print(mol.read(gz)[1].name) --> ethanol

-- errors: file, record, line, what was expected; with a function reading goes on
local mixed = write(".bad.sdf", water .. "$$$$\n" .. bad .. "$$$$\n" .. methanol .. "$$$$\n")
print(short(fails(mol.read, mixed))) --> FILE.bad.sdf: record 2, line 12, columns 32 to 34: 'Xx' is no element; a symbol such as C or Cl was expected
local problems = {}
list = mol.read(mixed, function(problem) problems[#problems + 1] = problem end)
print(#list, #problems, problems[1].line, problems[1].code) --> 2	1	12	bad value
local ok, problem = pcall(mol.read, write(".bad.smi", "CCO\nC(C x\n"))
print(ok, short(problem.message):match "^FILE.bad.smi: record 2, line 2, column ") --> false	FILE.bad.smi: record 2, line 2, column 
print(short(fails(mol.read, base .. ".none.sdf"))) --> cannot open 'FILE.none.sdf': No such file or directory
print(short(fails(mol.each, base .. ".none"))) --> the name 'FILE.none' does not tell what is in the file; .sdf, .mol or .smi was expected, or one of them with .gz
print(fails(mol.read, "/")) --> the name '/' does not tell what is in the file; .sdf, .mol or .smi was expected, or one of them with .gz
print(fails(mol.read)) --> mol.read: a file name is expected, not a nil
print(fails(mol.each, "a\0b.sdf")) --> mol.each: a NUL byte in the file name
print(fails(mol.read, smi, 7)) --> mol.read: a function for records that cannot be read is expected, not a number

-- an iterator goes on behind a bad record, stays at its end, and may be left early
local following, _, _, file = mol.each(mixed)
print(following().name, pcall(following) == false, following() == mol "CO", following(), following()) --> water	true	true	nil	nil
for m in mol.each(mixed) do print(m.name) break end --> water
file:close()
file:close()
following, _, _, file = mol.each(mixed)
file:close()
print(following()) --> nil
print(pcall(file.next, 7) == false, getmetatable(file)) --> true	false

-- memory stays as it is over many records
local long = write(".long.smi", ("CC(C)C(=O)Oc1ccccc1 ester\n"):rep(3000))
local count, peak = 0, 0
collectgarbage()
local start = collectgarbage "count"
for m in mol.each(long) do
    count = count + 1
    if count % 500 == 0 then
        collectgarbage()
        peak = math.max(peak, collectgarbage "count" - start)
    end
end
print(count, peak < 100) --> 3000	true

-- molfiles out: what comes back is the same, stereo included
for _, smiles in ipairs { "C[C@H](N)C(=O)O", "F/C=C/Cl", "[NH4+].[Cl-]", "c1ccncc1", "[13CH4]" } do
    local m = mol(smiles)
    for _, version in ipairs { "auto", "V2000", "V3000" } do
        local back = mol.read(write(".back.mol", (m:molfile(version))))
        if #back ~= 1 or back[1] ~= m then print(smiles, version, back[1]) end
    end
end
print(#mol.read(sdf)[1]:molfile() > 0, mol.read(sdf)[1]:molfile():match "^[^\n]*", mol("C"):molfile():match "^[^\n]*" == "") --> true	water	true
print(mol("CCO"):molfile():match "V%d+", mol("CCO"):molfile("V3000"):match "V%d+", select("#", mol("CCO"):molfile())) --> V2000	V3000	1
print((fails(mol("C").molfile, mol "C", "V1"):gsub("^.-%(", "("))) --> (invalid option 'V1')

for _, path in ipairs(made) do os.remove(path) end
