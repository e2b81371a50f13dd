-- For lua-check: the words that scripts and packs of backsaw have beside Lua 5.4.
--   luacheck stdlib examples            (copy this file beside packs of your own)
std = "lua54"
max_line_length = false -- patterns cannot be broken
read_globals = {
    "mol", "pattern", "rewrite", "transform", "back", "forth", "draft",
    "pack", "use", "synthon", "disconnection", "interconversion", "preference", "example", "refuse",
    "group", "conditions", "verdict", "protecting", "incompatible",
    "catalogue", "plan", "cost", "routes", "help",
}
-- The names of the arguments of `when` and `prefer` tell what they are, used or not.
unused_args = false
