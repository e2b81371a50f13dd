-- Pairs of groups that react with each other inside one molecule. Common practice, no source, unless said otherwise.
--
-- A pair counts where both groups are in one precursor and not both are the wanted change. Without `conditions` it counts
-- whatever is done; with them, under these classes only. `verdict` is "attacked" unless it says "slow": such a compound can
-- be had with care, as a salt, cold, or fresh.

pack {
    name = "incompatible",
    version = "0.1.0",
    licence = "CC0-1.0",
    about = "Pairs of groups that react with each other inside one molecule",
    needs = { "groups", "conditions" },
}

-- Acylating agents beside nucleophiles.

incompatible "acylating agent with O-H or N-H" {
    { "acyl-halide", "isocyanate", "sulfonyl-chloride" },
    { "primary-amine", "secondary-amine", "primary-aniline", "secondary-aniline", "alcohol", "phenol", "thiol",
        "hydrazine", "azole-nh", "amidine", "amidoxime", "hydroxamic-acid", "thiourea", "phosphorus-acid",
        "sulfonic-acid" },
    why = "acylates itself or its neighbour",
}

incompatible "acyl chloride with acid" {
    "acyl-halide", "carboxylic-acid",
    why = "the reagent that made it takes both acids, and base gives the anhydride",
}

incompatible "acyl chloride with basic nitrogen" {
    "acyl-halide", { "tertiary-amine", "pyridine" },
    verdict = "slow", why = "stable as the salt only",
}

incompatible "anhydride or activated ester with amine" {
    { "anhydride", "activated-ester" },
    { "primary-amine", "secondary-amine", "primary-aniline", "hydrazine", "thiol" },
    why = "acylates itself or its neighbour",
}

incompatible "anhydride with alcohol" {
    "anhydride", { "primary-alcohol", "secondary-alcohol", "phenol" },
    verdict = "slow", why = "acylated on warming or with base",
}

-- Amines beside electrophiles.

incompatible "amine with ester" {
    { "primary-amine", "secondary-amine", "hydrazine" }, "ester",
    verdict = "slow", why = "lactam or diketopiperazine; keep it as the salt",
}

incompatible "amine with ester, hot" {
    { "primary-amine", "secondary-amine", "hydrazine" }, "ester",
    conditions = { "amine-heat", "heat-200", "alkoxide" },
    why = "aminolysis inside the molecule or between two",
}

incompatible "amine with alkyl halide" {
    { "primary-amine", "secondary-amine", "tertiary-amine" }, { "alkyl-halide", "alkyl-sulfonate" },
    why = "alkylates itself or its neighbour; stable as the salt only",
}

incompatible "aniline or thiol with reactive halide" {
    { "primary-aniline", "secondary-aniline", "thiol" },
    { "alkyl-iodide", "allylic-halide", "benzylic-halide", "alpha-halo-carbonyl" },
    why = "alkylates itself or its neighbour",
}

incompatible "amine with aldehyde" {
    { "primary-amine", "secondary-amine", "hydrazine" }, "aldehyde",
    why = "condenses to the imine or enamine",
}

incompatible "aromatic amine with aldehyde" {
    "primary-aniline", "aldehyde",
    verdict = "slow", why = "condenses to the imine",
}

incompatible "amine with ketone" {
    { "primary-amine", "hydrazine" }, "ketone",
    verdict = "slow", why = "condenses to the imine; keep it as the salt",
}

incompatible "amine with epoxide" {
    { "primary-amine", "secondary-amine" }, { "epoxide", "aziridine" },
    why = "opens the ring inside the molecule or between two",
}

-- Michael acceptors.

incompatible "Michael acceptor with amine or thiol" {
    { "michael-acceptor", "quinone", "activated-alkyne" }, { "primary-amine", "secondary-amine", "thiol" },
    why = "conjugate addition inside the molecule or between two",
}

incompatible "thiol with electrophile in base" {
    "thiol", { "alkyl-halide", "alkyl-sulfonate", "epoxide", "activated-aryl-halide" },
    conditions = { "base-aq-mild", "base-aq-strong", "alkoxide", "base-hindered", "alkylation", "amine-rt", "amine-heat",
        "acylation" },
    why = "the thiolate closes a ring or couples",
}

incompatible "alkoxide or phenolate with alkyl halide" {
    { "alcohol", "phenol" }, { "alkyl-halide", "alkyl-sulfonate" },
    conditions = { "base-aq-strong", "alkoxide", "base-hindered", "alkylation" },
    why = "the anion closes a ring (an epoxide, a cyclic ether) or couples",
}

incompatible "acid with alkyl halide in base" {
    "carboxylic-acid", { "alkyl-halide", "alkyl-sulfonate" },
    conditions = { "base-aq-strong", "alkylation", "amine-heat" },
    why = "the carboxylate closes a lactone or couples",
}

-- Organometallic compounds cannot be made beside these.

incompatible "organometal with electrophile" {
    "organometal",
    { "aldehyde", "ketone", "ester", "acyl-halide", "anhydride", "isocyanate", "nitrile", "epoxide", "imide", "nitro",
        "alkyl-iodide", "weinreb-amide", "michael-acceptor" },
    why = "the reagent adds to its own electrophile",
}

incompatible "organometal with acidic hydrogen" {
    "organometal",
    { "carboxylic-acid", "alcohol", "phenol", "thiol", "primary-amine", "secondary-amine", "primary-aniline",
        "secondary-aniline", "azole-nh", "terminal-alkyne", "primary-amide", "secondary-amide", "sulfonamide-nh",
        "carbamate-nh", "urea", "amidine", "hydroxamic-acid", "sulfonic-acid", "phosphorus-acid" },
    why = "the reagent is quenched by its own acidic hydrogen",
}
