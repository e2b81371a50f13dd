-- help() and help "topic": short texts for the prompt.
local core = ...
local check = core.module "check"

local topics = {
molecules = [[
m = mol "CCOC(=O)c1ccc(N)cc1"        a molecule from SMILES; print(m) gives its canonical SMILES
m:formula() m:mass() m:exact_mass()  Hill formula, g/mol, u
m:charge() m:inchi() m:inchikey() m:smiles()
m:doubts()                           a list of what is strange: valences, stereo marks, ...
m:complexity()                       Bertz's index: the larger, the more involved
m:has(p) m:count(p) m:find(p)        p is a pattern or SMARTS; find gives lists of atom numbers
m:atoms() m:bonds() m:rings() m:fragments()
m:ring_systems() m:skeleton()          rings that share bonds; rings and what joins them
m:environment(atom, radius)            what lies around an atom; equal keys mean alike
m:similarity(n) m:fingerprint()        how alike two molecules are, 0 to 1
a == b                               the same compound, however it was written
m:polarity(a, b)                     a and d labels of a bond, or how two heteroatoms stand
mol.read "list.sdf"                  the molecules of a file as a list: .smi .mol .sdf, also .gz
for m in mol.each "list.sdf" do      one after the other, for files of any length
m.name  m.fields["CAS"]              what the file says of it
mol.write("list.sdf", list)          w = mol.writer(path), w:write(m), w:close() for long files
m:molfile()  m:molfile "V3000"       a molfile with a flat drawing]],
patterns = [[
p = pattern "[NX3;H2]"               a pattern from SMARTS; print(p) gives the SMARTS
p:count(m) p:find(m) p:has(m)        matches are unique by their set of atoms
r = rewrite "[C:1]=[O:2]>>[C:1]-[O:2]"
r:apply(m, ...)                      a list of outcomes, each a list of molecules]],
transforms = [[
t = transform "name"                 by name; case, spaces and hyphens make no difference
t:back(m)                            the steps that make m by this transform
t:forth(m, ...)                      what it makes of these: sets with products and expected
t:why(m)                             why it gives steps to m, or none; m:ideas() asks all
t:check()                            its self-tests: true, or false and the failures
back(m)  forth(m, ...)               the same with every transform in use
A step has product, precursors, equivalents, transform, conditions, recipe, yield, rivals, minor,
clashes, worries, and uses(reagent).]],
packs = [[
use "./ours.lua"                     a pack by file, or use "ours" by name: beside the script,
                                     on BACKSAW_PATH, in the standard library
pack { name =, version =, licence =, about =, needs = }
synthon "name" { kind = "donor" or "acceptor", equivalents = { { attach = "Cl" }, ... } }
disconnection "name" { target =, cut = { 1, 2 }, acceptor = { 1, "..." }, donor = { 2, "..." } }
interconversion "name" { target =, from = }
example { "product", from = { ... } }   refuse { "product" }     inside the tables
draft "A.B>>P"                       the text of a transform from one reaction, to be edited;
                                     a second result: does it give its example back?
Further fields: conditions recipe yield reagents cautions spares also_attacks source rxno also
when prefer step_cost about]],
groups = [[
m:groups()                           functional groups, each with group and atoms
m:clashes("lialh4", { reacting = { 2, 3 } })
                                     what the conditions attack elsewhere: group atoms verdict why;
                                     a second list has the cautions (slow)
verdict { group = "ester", conditions = "nabh4", "slow", why = "..." }    corrects a verdict
group "id" { smarts =, parents =, also =, examples =, non_examples = }
conditions "id" { attacks = { "group", { "group", why = } }, slow =, survives =, reagents = }
step.clashes  step.worries           what the step attacks, what needs care, in which precursor
step:protections()                   protecting groups that would help
step:simplification()                rings, stereo and complexity that the step takes away
protecting "id" { guards =, installed_by =, removed_by =, group =, example = }
incompatible "id" { { "groups" }, { "groups" }, conditions =, why = }]],
catalogues = [[
catalogue.build { from = "list.tsv", into = "list.catalogue" }
c = catalogue.open "list.catalogue"
c:find(m)                            offers, the cheapest first: code name molecule
                                     price_per_gram container_g lead_days ground
c:has(m)  #c]],
plan = [[
routes = plan { target = mol "...", catalogue = c, ... }
catalogue   a catalogue, or a list in order of preference; a plain list of SMILES serves too
limits      { depth =, steps =, molecules =, seconds =, memory = }
cost        cost.per_mole { step = 50 }, cost.additive { step = }, or function(step)
clashes     "penalise" (a clash costs two more steps, or clash_cost), "allow" or "refuse"
allow       function(step): may the step be used?      keep  function(route): does it count?
rank        function(route): the lowest first          best  how many routes
known       { { product =, from = { ... }, yield =, cost =, equiv =, name = }, ... }
transforms  names of those to use; {} switches them off     at_hand, quiet
constraints { avoid =, use =, ... }: see help "constraints"]],
constraints = [[
plan { ..., constraints = { ... } } says what a route must be like:
avoid, use      lists of words, molecules, patterns, transforms, as for step:uses
at_most         { 1, "ozone" }: so many steps may use it
start_from      compounds that a route must buy        not_bought  compounds not to be bought
intact          patterns that no step may build
keep            { 1, 2 }: bonds between these map numbers of the target are not cut
cut, first      { 1, 2 }: this bond is cut; before any other disconnection
protections     steps that put a protecting group on   unprotect = true: they come off again
longest         steps in line                          convergent = true: two branches meet]],
routes = [[
print(routes)                        a table, one line a route
#routes  routes[1]  routes:where(f)  routes:sort(f)  routes:gaps()  routes.complete  routes.reason  routes.warnings
routes:why(m)  routes:unsolved()     what became of a molecule; what stayed open
routes:transforms()                  how the transforms did: tried, found, refused, used, fault
routes:merge(others)                 both lists in one, each route once
routes:save "r.json"                 and routes.load "r.json"
print(routes[1])                     the route as an indented tree
routes[1]:compare(routes[2])         what is shared, what differs
routes[1]:json()  routes[1]:verify()
r.cost  r:steps()  r:leaves()  r:measure()      steps longest leaves cost yield_low yield yield_high]],
}

local order = { "molecules", "patterns", "transforms", "packs", "groups", "catalogues", "plan", "routes" }

-- help() lists the topics; help "plan" explains one.
return function(topic)
    if topic == nil then
        print("backsaw is Lua 5.4 with chemistry inside. help \"topic\" explains one of these:")
        print("  " .. table.concat(order, "  "))
        return
    end
    if type(topic) ~= "string" then check.fail("help: a topic is expected, such as \"plan\"") end
    local text = topics[topic] or topics[topic .. "s"]
    if not text then
        local meant = check.meant(topic, order)
        core.fail("not found", string.format("no help on '%s'%s", topic,
            meant ~= "" and meant or "; topics are: " .. table.concat(order, ", ")))
    end
    print(text)
end
