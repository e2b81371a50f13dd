-- Patterns and how they match. Counts are worked out by hand.
local amine = pattern "[NX3;H2]"
print(amine, amine:count(mol "NCCN"), amine:count "NCCN", amine:has "CCO") --> [NX3;H2]	2	2	false

-- unique by the set of atoms: each bond of benzene once, not twice
print(pattern("cc"):count "c1ccccc1", #pattern("cc"):find "c1ccccc1") --> 6	6
print(pattern("c1ccccc1"):count "c1ccccc1") --> 1

-- atoms stand in the order of the pattern, numbered from 1
local found = pattern("[OX2H][CX4]"):find "CCO"
print(#found, found[1][1], found[1][2]) --> 1	3	2
print(#pattern("N"):find "CCO") --> 0

print(getmetatable(amine)) --> false
print(fails(pattern, 12)) --> argument 1: SMARTS expected, got number
