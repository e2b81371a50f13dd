-- Molecules. Formulas and masses are textbook values (molar masses from the abridged standard
-- atomic weights of 2021); atom numbers follow the text.
local benzocaine = mol "CCOC(=O)c1ccc(N)cc1"
print(benzocaine:formula(), string.format("%.2f", benzocaine:mass())) --> C9H11NO2	165.19
print(string.format("%.4f", benzocaine:exact_mass())) --> 165.0790
print(benzocaine:charge(), mol("[NH4+]"):charge(), mol("[O-]S(=O)(=O)[O-]"):charge()) --> 0	1	-2

-- equal however they are written, and a fixed point of reading and writing
print(mol "OCC" == mol "CCO", mol "C(C)O" == mol "CCO", mol "CCO" == mol "COC") --> true	true	false
print(mol(benzocaine:smiles()) == benzocaine, benzocaine:smiles() == tostring(benzocaine)) --> true	true
print(mol "c1ccccc1C" == mol "CC1=CC=CC=C1") --> true
print(mol "C[C@H](N)O" == mol "C[C@@H](N)O", mol "F/C=C/F" == mol "F/C=C\\F") --> false	false
print(mol "C" == "C", mol(benzocaine) == benzocaine) --> false	true
print(#mol("[CH3:7]O"):smiles "labels" > #mol("[CH3:7]O"):smiles()) --> true
print(mol("C[C@H](N)O"):smiles "plain" == mol("CC(N)O"):smiles()) --> true

-- InChI of ethanol and its key are those of the standard
print(mol("OCC"):inchi()) --> InChI=1S/C2H6O/c1-2-3/h3H,2H2,1H3
print(mol("OCC"):inchikey()) --> LFQSCWFLJHTTHZ-UHFFFAOYSA-N

-- atoms: in the order of the input, hydrogens counted
local atoms = mol("C[NH2+:3]c1ccccc1"):atoms()
print(#atoms, atoms[1].element, atoms[1].hydrogens, atoms[1].degree) --> 8	C	3	1
print(atoms[2].element, atoms[2].charge, atoms[2].hydrogens, atoms[2].carbons, atoms[2].label) --> N	1	2	2	3
print(atoms[3].aromatic, atoms[1].aromatic, atoms[3].ring, atoms[1].ring) --> true	false	true	false
print(mol("[13CH4]"):atoms()[1].isotope, mol("C"):atoms()[1].isotope) --> 13	0

-- bonds and rings
local bonds = mol("C=CC#N"):bonds()
print(#bonds, bonds[1][1], bonds[1][2], bonds[1].order, bonds[2].order, bonds[3].order) --> 3	1	2	2	1	3
print(mol("F/C=C/F"):bonds()[2].geometry, mol("FC=CF"):bonds()[2].geometry) --> trans	nil
print(#mol("c1ccc2ccccc2c1"):rings(), #mol("c1ccc2ccccc2c1"):rings()[1], #mol("CC"):rings()) --> 2	6	0

-- CIP labels: L-alanine is S, L-cysteine R; fumaric acid is E; one centre of the meso pentaric acid is r or s
print(mol("N[C@@H](C)C(=O)O"):atoms()[2].cip, mol("N[C@@H](CS)C(=O)O"):atoms()[2].cip, mol("CCO"):atoms()[1].cip) --> S	R	nil
print(mol("OC(=O)/C=C/C(=O)O"):bonds()[4].cip, mol("OC(=O)/C=C\\C(=O)O"):bonds()[4].cip, mol("CC=CC"):bonds()[2].cip) --> E	Z	nil
print(mol("C[C@H](O)[C@H](Cl)[C@@H](C)O"):atoms()[4].cip, mol("C[C@H](O)[C@@H](Cl)[C@@H](C)O"):atoms()[4].cip) --> s	r

-- fragments
local pieces = mol("[Na+].[C-]#N.O"):fragments()
print(#pieces, pieces[1] == mol "[Na+]", pieces[2] == mol "N#[C-]", pieces[3] == mol "O") --> 3	true	true	true

-- matches
print(benzocaine:has "[NX3;H2]", benzocaine:has(pattern "S"), benzocaine:count "[CX3](=O)[OX2]") --> true	false	1
print(table.concat(mol("OCCO"):find("CO")[2], " "), #mol("CC"):find "N") --> 3 4	0

-- matches: a limit, and every embedding (a benzene ring lies on itself in 12 ways)
print(#mol("CCO"):find("C", 1), #mol("CCO"):find("C"), #mol("c1ccccc1"):find("c1ccccc1"), #mol("c1ccccc1"):find("c1ccccc1", { all = true })) --> 1	2	1	12
print(#pattern("cc"):find("c1ccccc1", { all = true, limit = 5 })) --> 5

-- rings and skeleton: cubane has six faces, five of them make a smallest set; spiro rings share no bond
local cubane = mol "C12C3C4C1C5C2C3C45"
print(#cubane:rings(), #cubane:rings "smallest", #cubane:rings "relevant", #cubane:ring_systems()) --> 5	5	6	1
print(#mol("C1CC12CCC2"):ring_systems(), #mol("CCO"):ring_systems()) --> 2	0
print(mol("CC(=O)Nc1ccc(CC2CC2)cc1"):skeleton() == mol "c1ccc(CC2CC2)cc1", mol("CCO"):skeleton()) --> true	nil
print(mol("O=C1CCCC1C"):skeleton() == mol "O=C1CCCC1") --> true

-- environments and likeness
local around = mol("CC(=O)OCC"):environment(4, 1)
print(table.concat(around.atoms, " "), table.concat(around.distances, " "), #around.bonds) --> 4 2 5	0 1 1	2
print(mol("CCCO"):environment(4, 2).key == mol("OCCC"):environment(1, 2).key, mol("CCCO"):environment(4).key == mol("CCCN"):environment(4).key) --> true	false
print(mol("CC=O"):environment({ 2, 3 }, 0).key == mol("O=CCC"):environment({ 1, 2 }, 0).key) --> true
print(mol("CCO"):similarity "OCC", mol("CCO"):similarity "c1ccccc1", #mol("CC"):fingerprint(0)) --> 1.0	0.0	1
print(mol("CC=O"):atoms()[2].hybridisation, mol("CC#N"):atoms()[3].hybridisation) --> 2	1

-- doubts
print(#mol("CCO"):doubts(), mol("C[C@H](C)O"):doubts()[1]) --> 0	atom 2 (C): it was marked as a stereo centre, but is none

-- complexity: values of tests/data/checks/complexity.json
print(string.format("%.5f %.5f %.1f", mol("CC(=O)Oc1ccccc1C(=O)O"):complexity(), mol("CCO"):complexity(), mol("C"):complexity())) --> 343.22287 2.75489 0.0

-- locked, and deaf to strangers
print(getmetatable(benzocaine)) --> false
print(fails(benzocaine.formula)) --> argument 1: molecule expected, got nothing
print(fails(benzocaine.find, benzocaine, "C", -1)) --> bad argument #3 to '?' (a limit is 1 or more, or 0 for none)
print(fails(benzocaine.environment, benzocaine, 99)) --> bad argument #2 to '?' (no such atom)
print(fails(mol)) --> mol: argument 1: molecule or SMILES expected, got nil
