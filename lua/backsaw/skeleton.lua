-- The text of a new pack, to be filled in. It loads and passes its own tests as it is.
local core = ...
local check = core.module "check"

local text = [=[
-- NAME: what this pack is for.
-- Rules are written backwards, from the product to its precursors. Try it: backsaw check NAME.lua

pack {
    name = "NAME",
    version = "0.1.0",          -- raise it with every change that others will see
    licence = "CC0-1.0",        -- what others may do with this text
    about = "One line on what is in it",
    needs = { "synthons" },     -- packs whose synthons, groups or classes of conditions are used here
}

-- A synthon is an imaginary half; its equivalents are what one weighs in. The pack "synthons" has the
-- common ones; give new ones a name of your own.
synthon "NAME benzyl" {
    kind = "acceptor",          -- or "donor"
    equivalents = {
        { attach = "Cl" },
        { attach = "OS(C)(=O)=O", name = "mesylate" },
    },
}

synthon "NAME cyanide" {
    kind = "donor",
    equivalents = { { attach = "[Na]", ionic = true } },
}

-- A disconnection cuts one bond, and says what each end is.
disconnection "NAME benzyl cyanide" {
    target   = "[c:4]-[CX4;H2:1]-!@[C:2]#[N:3]",       -- only tests; be as tight as the chemistry is
    cut      = { 1, 2 },                               -- map numbers of the target
    acceptor = { 1, "NAME benzyl" },
    donor    = { 2, "NAME cyanide" },
    conditions = "cyanide",                            -- the class that decides on clashes
    recipe   = "NaCN, DMSO, 40-60 °C",
    yield    = { 70, 90 },                             -- per cent
    cautions = { "sodium cyanide" },
    source   = "from memory; put your own notebook or paper here",
    -- when = function(m) return m.atom[1].carbons == 1 end,
    example { "COc1ccc(CC#N)cc1", from = { "COc1ccc(CCl)cc1", "[Na+].[C-]#N" } },
    refuse  { "N#CC(C)(C)c1ccccc1" },                  -- a tertiary centre: no SN2
}

-- An interconversion changes a functional group: the target is rewritten into its precursor.
interconversion "NAME alcohol from aldehyde" {
    target   = "[CX4;H2:1]([OX2H:2])[#6:3]",
    from     = "[C:1](=[O:2])[#6:3]",
    conditions = "nabh4",
    recipe   = "NaBH4, MeOH, 0 °C",
    yield    = { 85, 98 },
    source   = "from memory; put your own notebook or paper here",
    example { "OCc1ccccc1", from = { "O=Cc1ccccc1" } },
    refuse  { "CC(O)c1ccccc1" },                       -- from a ketone: another rule
}
]=]

-- text = skeleton(name)
return function(name)
    if not string.find(name, "^[%w_][%w_.-]*$") or #name > 100 then
        check.fail("'%s' is no name of a pack; letters, digits, '-', '_' and '.' are expected", name)
    end
    return (string.gsub(text, "NAME", name))
end
