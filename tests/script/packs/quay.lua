-- A pack for the tests: two rules, one with functions.
pack { name = "quay", version = "0.1.0", licence = "CC0-1.0", about = "For the tests",
    needs = { "quay-base" } }

disconnection "quay ether" {
    target = "[CX4;H2:1]-!@[OX2:2][c:3]", cut = { 1, 2 },
    acceptor = { 1, "quay alkyl" }, donor = { 2, "quay phenol" },
    recipe = "K2CO3, acetone", yield = { 80, 95 },
    when = function(m) return m.atom[1].carbons < 2 and not m.molecule:has "[NH2]" end,
    example { "CCOc1ccccc1", from = { "CCBr", "Oc1ccccc1" } },
    refuse { "CC(C)Oc1ccccc1", "CCOc1ccccc1N" },
}
