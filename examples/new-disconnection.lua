-- Trying a new disconnection. The scenario is invented: somebody at Quayside bench wants to make
-- benzyl sulfones from sodium sulfinates, and writes the idea down before it becomes a pack.
--
-- What comes out is for a trained chemist to judge; the supplier's current safety data sheet and
-- local rules prevail.

synthon "quayside benzyl" { kind = "acceptor",
    equivalents = { { attach = "Cl" }, { attach = "Br" } } }

-- The sulfinate: sulfur keeps both oxygens, one of them with the charge.
synthon "quayside sulfinate" { kind = "donor",
    equivalents = { { rewrite = "[S:1](=[O:2])=[O:3]>>[S:1](=[O:2])[O-:3].[Na+]", name = "sodium sulfinate" } } }

local rule = disconnection "quayside benzyl sulfone" {
    target   = "[c:4]-[CX4;H2:1]-!@[S:2](=[O:3])(=[O:5])[#6:6]",
    cut      = { 1, 2 },
    acceptor = { 1, "quayside benzyl" },
    donor    = { 2, "quayside sulfinate" },
    recipe   = "DMF, 60 °C", yield = { 60, 85 },
    cautions = { "N,N-dimethylformamide", "benzyl halides are lachrymators" },
    example { "CS(=O)(=O)Cc1ccccc1", from = { "ClCc1ccccc1", "CS(=O)[O-].[Na+]" } },
    refuse  { "CS(=O)(=O)C(C)c1ccccc1" },
}

local ok, failures = rule:check()
print("self-tests: " .. (ok and "passed" or table.concat(failures, "\n")))

-- Backwards: what a target would be made from.
local target = mol "Cc1ccc(cc1)S(=O)(=O)Cc1ccc(F)cc1"
print("\n" .. tostring(target))
for _, step in ipairs(rule:back(target)) do
    print("  from " .. table.concat({ tostring(step.precursors[1]), tostring(step.precursors[2]) }, " + "))
    for _, rival in ipairs(step.rivals) do print("    rival " .. tostring(rival[1])) end
end

-- Forwards: what the reagents give, and what else they could.
print("\nforwards, from two benzylic chlorides in one molecule:")
for _, set in ipairs(rule:forth(mol "ClCc1ccc(CCl)cc1", mol "Cc1ccc(cc1)S(=O)[O-].[Na+]")) do
    local names = {}
    for i, product in ipairs(set.products) do names[i] = tostring(product) end
    print((set.expected and "  gives " or "  rival ") .. table.concat(names, " + "))
end
