-- Which product is the major one: shared rules, each by the roles that atoms have in it. Rules of any pack may name them:
-- prefer = { "markovnikov", carbon = 1 }. A score is compared only with those of other products of the same reactants.
-- Rules of thumb of the textbooks; the numbers order products and predict no ratios. From memory unless a source says otherwise.

pack {
    name = "preferences",
    version = "0.1.0",
    licence = "CC0-1.0",
    about = "Which product is the major one: shared rules for the other packs",
}

-- Ionic addition to a double bond: the nucleophile ends where the cation is the more stable one.
preference "markovnikov" {
    roles = { "carbon" }, -- that gets the nucleophile
    source = "Clayden, Greeves, Warren, Organic Chemistry; from memory",
    score = function(product, m) return m.atom.carbon.carbons end,
}

-- Hydroboration, radical addition of HBr: the other way round.
preference "anti-markovnikov" {
    roles = { "carbon" },
    source = "Clayden, Greeves, Warren, Organic Chemistry; from memory",
    score = function(product, m) return -m.atom.carbon.carbons end,
}
