---@meta backsaw
-- Definitions for the Lua language server: what scripts and packs of backsaw have beside Lua 5.4.
-- Put this folder into the setting `workspace.library` of the server. The file is read, never run.

---@alias backsaw.Compound backsaw.Molecule|string a molecule, or SMILES
---@alias backsaw.Query backsaw.Pattern|string a pattern, or SMARTS

-- ---- Molecules ---------------------------------------------------------------------------------

---@class backsaw.Atom
---@field element string
---@field hydrogens integer all of them
---@field charge integer
---@field isotope integer
---@field aromatic boolean
---@field ring boolean
---@field degree integer
---@field carbons integer neighbours that are carbon
---@field label integer atom class
---@field symmetry integer atoms that are alike share a number
---@field hybridisation integer 1 for sp, 2 for sp2, 3 for sp3
---@field cip string|nil R, S, r or s
---@field index integer|nil in a `when` function: its number in the molecule

---@class backsaw.Bond
---@field [1] integer
---@field [2] integer
---@field order integer
---@field aromatic boolean
---@field ring boolean
---@field geometry string|nil "cis" or "trans"
---@field cip string|nil E or Z

---@class backsaw.Clash
---@field group string
---@field atoms integer[]
---@field verdict "attacked"|"slow"
---@field why string|nil
---@field precursor integer|nil
---@field other string|nil

---@class backsaw.Polarity
---@field atoms integer[]
---@field labels string[]
---@field donor integer
---@field acceptor integer
---@field umpolung string[]
---@field relation string|nil
---@field verdict string|nil
---@field paths integer[]|nil
---@field chain integer[]|nil
---@field cuts backsaw.Polarity[]|nil

---@class backsaw.Molecule
---@field name string|nil what its file says
---@field fields table<string|integer, string>|nil
---@field stereo_groups table[]|nil
local Molecule = {}
---@param form? "labels"|"plain"
---@return string
function Molecule:smiles(form) end
---@return string
function Molecule:formula() end
---@return number g/mol
function Molecule:mass() end
---@return number u
function Molecule:exact_mass() end
---@return integer
function Molecule:charge() end
---@return number
function Molecule:complexity() end
---@return string
function Molecule:inchi() end
---@return string
function Molecule:inchikey() end
---@return string[]
function Molecule:doubts() end
---@param p backsaw.Query
---@return boolean
function Molecule:has(p) end
---@param p backsaw.Query
---@return integer
function Molecule:count(p) end
---@param p backsaw.Query
---@param limit? integer|{ all: boolean?, limit: integer? }
---@return integer[][]
function Molecule:find(p, limit) end
---@return backsaw.Atom[]
function Molecule:atoms() end
---@return backsaw.Bond[]
function Molecule:bonds() end
---@param which? "relevant"
---@return integer[][]
function Molecule:rings(which) end
---@return integer[][]
function Molecule:ring_systems() end
---@return backsaw.Molecule|nil
function Molecule:skeleton() end
---@param atom integer|integer[]
---@param radius? integer
---@return { atoms: integer[], distances: integer[], bonds: table[], key: string }
function Molecule:environment(atom, radius) end
---@param other backsaw.Compound
---@return number
function Molecule:similarity(other) end
---@param radius? integer
---@param bits? integer
---@return integer[]
function Molecule:fingerprint(radius, bits) end
---@return backsaw.Molecule[]
function Molecule:fragments() end
---@return { group: string, atoms: integer[] }[]
function Molecule:groups() end
---@param conditions string
---@param given? { reacting: integer[] }
---@return backsaw.Clash[] clashes
---@return backsaw.Clash[] cautions
function Molecule:clashes(conditions, given) end
---@param a integer
---@param b integer
---@return backsaw.Polarity|nil
function Molecule:polarity(a, b) end
---@param version? "V2000"|"V3000"
---@return string molfile
---@return integer|nil lost
function Molecule:molfile(version) end
---@return table[]
function Molecule:ideas() end
---@param atom integer
---@param kind "electrophile"|"nucleophile"
---@param without? integer
---@param bulk? number
---@return number
function Molecule:rate(atom, kind, without, bulk) end
---@param atom integer
---@param kind "cation"|"radical"|"anion"
---@param without? integer
---@return number
function Molecule:stability(atom, kind, without) end
---@param atom integer
---@return table[]
function Molecule:neighbours(atom) end

---@class backsaw.Writer
local Writer = {}
---@param m backsaw.Compound
---@param given? { name: string?, fields: table<string, string>? }
function Writer:write(m, given) end
function Writer:close() end

---@class backsaw.MoleculeWord
---@overload fun(smiles: backsaw.Compound): backsaw.Molecule
mol = {}
---@param path string
---@param refused? fun(problem: backsaw.Error)
---@return backsaw.Molecule[]
function mol.read(path, refused) end
---@param path string
---@param refused? fun(problem: backsaw.Error)
---@return fun(): backsaw.Molecule|nil
function mol.each(path, refused) end
---@param path string
---@param list backsaw.Compound[]
function mol.write(path, list) end
---@param path string
---@return backsaw.Writer
function mol.writer(path) end

---@class backsaw.Error
---@field code string
---@field message string
---@field position integer|nil
---@field where string|nil

-- ---- Patterns and rewritings -------------------------------------------------------------------

---@class backsaw.Pattern
local Pattern = {}
---@param m backsaw.Compound
---@return boolean
function Pattern:has(m) end
---@param m backsaw.Compound
---@return integer
function Pattern:count(m) end
---@param m backsaw.Compound
---@param limit? integer|{ all: boolean?, limit: integer? }
---@return integer[][]
function Pattern:find(m, limit) end

---@class backsaw.Rewriting
local Rewriting = {}
---@param ... backsaw.Compound
---@return backsaw.Molecule[][]
function Rewriting:apply(...) end

---@param smarts string
---@return backsaw.Pattern
function pattern(smarts) end
---@param text string reaction SMARTS, read forwards
---@return backsaw.Rewriting
function rewrite(text) end

-- ---- Transforms and steps ----------------------------------------------------------------------

---@class backsaw.Way
---@field transform string
---@field conditions string|nil
---@field recipe string|nil
---@field yield number[]|nil

---@class backsaw.Step
---@field product backsaw.Molecule
---@field precursors backsaw.Molecule[]
---@field equivalents number[]
---@field transform string
---@field pack string|nil
---@field conditions string|nil
---@field recipe string|nil
---@field source string|nil
---@field yield number[]|nil per cent
---@field reagents string[]
---@field cautions string[]
---@field clashes backsaw.Clash[]
---@field worries backsaw.Clash[]
---@field reacting integer[][]
---@field rivals backsaw.Molecule[][]
---@field minor boolean|nil
---@field polarity backsaw.Polarity|nil
---@field cost number|nil of steps of a route
---@field known boolean|nil
---@field checked boolean|nil
---@field ways backsaw.Way[]|nil
local Step = {}
---@param reagent string|backsaw.Molecule|backsaw.Pattern
---@return boolean
function Step:uses(reagent) end
---@return table[]
function Step:protections() end
---@return { rings: integer, stereo: integer, complexity: number, pieces: integer, halves: boolean }
function Step:simplification() end

---@class backsaw.ProductSet
---@field products backsaw.Molecule[]
---@field expected boolean
---@field major boolean
---@field kind string|nil
---@field transform string

---@class backsaw.Transform
---@field name string
---@field kind "disconnection"|"interconversion"
---@field target string
---@field from string|nil
---@field conditions string|nil
---@field recipe string|nil
---@field yield number[]|nil
---@field source string|nil
---@field pack string|nil
---@field also string[]
---@field cautions string[]
---@field reagents string[]
local Transform = {}
---@param m backsaw.Compound
---@param given? { minor: boolean }
---@return backsaw.Step[]
function Transform:back(m, given) end
---@param ... backsaw.Compound
---@return backsaw.ProductSet[]
function Transform:forth(...) end
---@param m backsaw.Compound
---@return table
function Transform:why(m) end
---@return boolean ok
---@return string[] failures
function Transform:check() end

---@param name string|backsaw.Transform
---@return backsaw.Transform
function transform(name) end
---@param m backsaw.Compound
---@param given? { minor: boolean }
---@return backsaw.Step[]
function back(m, given) end
---@param ... backsaw.Compound
---@return backsaw.ProductSet[]
function forth(...) end
---@param reaction string
---@param given? { radius: integer, name: string }
---@return string text
---@return boolean works
function draft(reaction, given) end

-- ---- Rules and packs ---------------------------------------------------------------------------

---@class backsaw.Site
---@field molecule backsaw.Molecule
---@field atom table<integer|string, backsaw.Atom>

---@class backsaw.RuleFields
---@field target string
---@field from? string|string[]
---@field cut? integer[]
---@field acceptor? table { map, "synthon" }
---@field donor? table { map, "synthon" }
---@field conditions? string
---@field spares? string[]
---@field also_attacks? string[]
---@field recipe? string
---@field reagents? string[]
---@field cautions? string[]
---@field yield? number|number[]
---@field step_cost? number
---@field source? string
---@field rxno? string
---@field about? string
---@field also? string|string[]
---@field when? fun(m: backsaw.Site): boolean
---@field prefer? fun(product: backsaw.Molecule, m: backsaw.Site): number|table
---@field addition? table { "syn" or "anti", map, map }

---@param given { name: string, version: string?, licence: string?, about: string?, authors: string[]?, source: string?, needs: string[]? }
function pack(given) end
---@param name string
---@return fun(given: { kind: "donor"|"acceptor", equivalents: table, about: string?, source: string? })
function synthon(name) end
---@param name string
---@return fun(given: backsaw.RuleFields): backsaw.Transform
function disconnection(name) end
---@param name string
---@return fun(given: backsaw.RuleFields): backsaw.Transform
function interconversion(name) end
---@param name string
---@return fun(given: { roles: string[], score: fun(product: backsaw.Molecule, m: backsaw.Site): number })
function preference(name) end
---@param given { [1]: string, from: string[], about: string?, source: string? }
---@return table
function example(given) end
---@param given string|string[]
---@return table
function refuse(given) end
---@param name string
---@return fun(given: { smarts: string, name: string?, parents: string[]?, also: string[]?, examples: table?, non_examples: string[]?, about: string?, source: string? })
function group(name) end
---@param name string
---@return fun(given: { name: string?, reagents: string?, used_for: string?, attacks: table?, slow: table?, survives: table?, also: string[]?, about: string?, source: string? })
function conditions(name) end
---@param given { [1]: "attacked"|"slow"|"survives", group: string|string[], conditions: string|string[], why: string?, source: string? }
function verdict(given) end
---@param name string
---@return fun(given: table)
function protecting(name) end
---@param name string
---@return fun(given: table)
function incompatible(name) end
---@param name string a file, or a name on the path
function use(name) end

-- ---- Catalogues --------------------------------------------------------------------------------

---@class backsaw.Offer
---@field code string|nil
---@field name string|nil
---@field molecule backsaw.Molecule
---@field price_per_gram number|nil
---@field container_g number|nil
---@field lead_days number|nil
---@field ground string

---@class backsaw.Catalogue
local Catalogue = {}
---@param m backsaw.Compound
---@return backsaw.Offer[]
function Catalogue:find(m) end
---@param m backsaw.Compound
---@return boolean
function Catalogue:has(m) end
function Catalogue:close() end

catalogue = {}
---@param path string
---@return backsaw.Catalogue
function catalogue.open(path) end
---@param given { from: string|string[], into: string }
---@return table report
function catalogue.build(given) end

-- ---- Plans and routes --------------------------------------------------------------------------

---@class backsaw.Plan
---@field target backsaw.Compound
---@field catalogue any
---@field at_hand? table
---@field limits? { depth: integer?, steps: integer?, molecules: integer?, seconds: number?, memory: integer? }
---@field cost? any
---@field clashes? "penalise"|"allow"|"refuse"
---@field clash_cost? number
---@field allow? fun(step: backsaw.Step): boolean
---@field keep? fun(route: backsaw.Route): boolean
---@field rank? fun(route: backsaw.Route): number
---@field known? table[]
---@field constraints? table
---@field strategy? "cheapest"|"proof"|"breadth"
---@field diverse? number
---@field transforms? table
---@field best? integer
---@field quiet? boolean
---@field trace? string
---@field threads? integer

---@param given backsaw.Plan
---@return backsaw.Routes
function plan(given) end

cost = {}
---@param given { step: number }
---@return table
function cost.per_mole(given) end
---@param given { step: number }
---@return table
function cost.additive(given) end

---@class backsaw.Measure
---@field steps integer
---@field runs integer
---@field longest integer
---@field leaves integer
---@field cost number
---@field yield_low number
---@field yield number
---@field yield_high number
---@field checked boolean

---@class backsaw.Route
---@field cost number
---@field rank number|nil
---@field target backsaw.Molecule
local Route = {}
---@return backsaw.Step[]
function Route:steps() end
---@return table[]
function Route:leaves() end
---@return backsaw.Measure
function Route:measure() end
---@return string
function Route:json() end
---@return boolean ok
---@return integer|nil step
---@return string|nil why
function Route:verify() end
---@param other backsaw.Route
---@return table
function Route:compare(other) end

---@class backsaw.Routes
---@field [integer] backsaw.Route
---@field target backsaw.Molecule
---@field complete boolean
---@field reason string|nil
---@field explored integer
local Routes = {}
---@param f fun(route: backsaw.Route): boolean
---@return backsaw.Routes
function Routes:where(f) end
---@param f fun(a: backsaw.Route, b: backsaw.Route?): any
---@return backsaw.Routes
function Routes:sort(f) end
---@param measures table
---@return backsaw.Routes
function Routes:pareto(measures) end
---@param given table
---@return backsaw.Routes
function Routes:extend(given) end
---@param given table
---@return backsaw.Routes
function Routes:rerank(given) end
---@param others backsaw.Routes
---@return backsaw.Routes
function Routes:merge(others) end
---@return table[]
function Routes:gaps() end
---@param m backsaw.Compound
---@return table
function Routes:why(m) end
---@return table[]
function Routes:unsolved() end
---@return table[]
function Routes:transforms() end
---@return { name: string, version: string? }[]
function Routes:packs() end
---@param path string
function Routes:save(path) end
---@param path string
---@return backsaw.Routes
function Routes:load(path) end

routes = {}
---@param path string
---@return backsaw.Routes
function routes.load(path) end

---@param topic? string
function help(topic) end
