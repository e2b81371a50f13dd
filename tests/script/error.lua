-- Error objects: code, message, position, and a text with a caret.
local ok, problem = pcall(mol, "CC(C")
print(ok, problem.code, math.type(problem.position)) --> false	syntax error	integer
print(type(problem.message), tostring(problem):find("CC%(C\n") ~= nil, tostring(problem):find "%^" ~= nil) --> string	true	true
print(getmetatable(problem)) --> error

-- the place in the script is that of the line that called
local _, late = pcall(function()
    local x = mol "CQ"
    return x
end)
print(late.where:match "error.lua:%d+$", late.position) --> error.lua:9	2

-- position counts from 1, also behind blanks
print(select(2, pcall(mol, "  CQ")).position) --> 4
print(select(2, pcall(pattern, "[C;")).code) --> syntax error
print(fails(mol, "")) --> the SMILES is empty
print(fails(mol, "CC O")) --> text behind the SMILES; one molecule is expected

-- names nearby
print(fails(plan, { taget = mol "C" })) --> plan: unknown field 'taget'; did you mean 'target'?
print(fails(help, "plam")) --> no help on 'plam'; did you mean 'plan'?
