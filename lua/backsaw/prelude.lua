-- The globals of scripts. In the pack state there are none: packs get theirs from `sandbox`.
local core = ...

core.module "step"
local transforms = core.module "transform"
local words = core.module "pack"
local group_words = core.module("group").words
if core.packed then return end

core.module "why"

local planning = core.module "plan"
local catalogues = core.module "catalogue"

-- mol "SMILES", mol.read(path) and mol.each(path)
mol = setmetatable(core.module "file", {
    __call = function(_, value)
        local m = core.mol(value) -- no tail call, so that messages name it
        return m
    end,
    __metatable = false,
})
pattern, rewrite = core.pattern, core.rewrite
transform, back, forth = transforms.fetch, core.back, core.forth
draft = core.draft
pack, synthon, disconnection, interconversion = words.pack, words.synthon, words.disconnection,
    words.interconversion
example, refuse, preference = words.example, words.refuse, words.preference
group, conditions, verdict = group_words.group, group_words.conditions, group_words.verdict
protecting, incompatible = group_words.protecting, group_words.incompatible
catalogue, plan, cost = catalogues, planning.plan, planning.cost
routes = core.module "routes"
core.module "explain"
help = core.module "help"

function use(name)
    if type(name) ~= "string" then
        core.fail("bad value", "use: the name or the file of a pack is expected, not a "
            .. type(name))
    end
    core.use(name)
end
