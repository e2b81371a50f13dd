-- A group's pack that stands before a standard rule. The scenario, yields and recipe are invented:
-- Quayside bench reduces nitroarenes with dithionite at a better yield than the standard rule
-- "nitro-reduction" states, and has found that benzyl ethers and aryl chlorides stay.
--
-- Use it: backsaw -l examples/quayside-anilines.lua plan SMILES -c CATALOGUE
-- What comes out is for a trained chemist to judge; the supplier's current safety data sheet and
-- local rules prevail.

pack {
    name = "quayside-anilines",
    version = "1.0.0",
    licence = "CC0-1.0",
    about = "Anilines from nitroarenes as Quayside bench makes them (invented)",
    needs = { "conditions" },
}

-- A class of its own, since the recipe is none of the standard ones.
conditions "quayside dithionite" {
    reagents = "Na2S2O4, K2CO3, MeCN/H2O, 20 °C",
    attacks = { { "nitro", why = "reduced to the amine" } },
    slow = { "aldehyde" },
}

-- The bench's correction of a standard verdict: with iron an alkyne needs care at this scale.
verdict { group = "alkyne", conditions = "fe-acid", "slow", why = "over-reduction seen on 50 g (invented)" }

-- The same change as "nitro-reduction" under a name of its own: one step with two ways to run it, of
-- which the cheaper is taken.
interconversion "quayside nitro-reduction" {
    target     = "[c:1][N;X3;H2;+0:2]",
    from       = "[c:1][N;X3;H0;+:2](=[O;X1])[O;X1;-]",
    conditions = "quayside dithionite",
    recipe     = "Na2S2O4, K2CO3, MeCN/H2O, 20 °C",
    yield      = { 95, 99 },
    cautions   = { "sodium dithionite" },
    source     = "invented",
    example { "Nc1ccc(Cl)cc1", from = { "[O-][N+](=O)c1ccc(Cl)cc1" } },
    example { "Nc1ccc(OCc2ccccc2)cc1", from = { "[O-][N+](=O)c1ccc(OCc2ccccc2)cc1" } },
    refuse { "NCc1ccccc1" }, -- amine not on the arene
}
