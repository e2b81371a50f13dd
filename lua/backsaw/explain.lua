-- Why a search ended as it did: what became of a molecule, what stayed open, how transforms did.
local core = ...
local check = core.module "check"

local answer = { __metatable = false, __tostring = function(a) return a.text end }

-- The routes of a list in which a compound is made, and in which it is bought.
local function places(list, smiles)
    local made, bought = {}, {}
    for i, route in ipairs(list) do
        local how = core.route_role(route, smiles)
        if how == "made" then made[#made + 1] = i end
        if how == "bought" then bought[#bought + 1] = i end
    end
    return made, bought
end

local function numbers(list)
    return (#list == 1 and "route " or "routes ") .. table.concat(list, ", ")
end

-- What became of steps that would make it.
local function steps_text(note)
    local refused = note.barred + note.disallowed
    if note.found == 0 then return "no_step", "no transform and no known step makes it" end
    local count = note.found == 1 and "1 step makes it" or note.found .. " steps make it"
    if refused == note.found then
        local by = {}
        if note.barred > 0 then by[1] = note.barred .. " by constraints" end
        if note.disallowed > 0 then by[#by + 1] = note.disallowed .. " by 'allow'" end
        return "refused", count .. ", all refused: " .. table.concat(by, ", ")
    end
    if not note.ways then
        return "left_out", count .. ", but none was taken in: it needed itself, or the limit of "
            .. "molecules was reached"
    end
    if note.cost then
        if note.price and note.price <= note.cost then
            return "dear", count .. ", none for less"
        end
        return "not_used", string.format("%s; it can be made at %.2f a mole, but no route of this list "
            .. "does so", count, note.cost)
    end
    return "gap", count .. ", but none from what can be had" .. (note.lacks
        and "; " .. note.lacks .. " is lacking" or "")
end

-- Why it was not expanded, or nil.
local function unexpanded_text(list, note)
    if note.expanded then return nil end
    if note.closed then
        return "closed", note.price and "it is at hand or bought, so nothing was looked for that makes it"
            or "no known step makes it, and transforms are not asked"
    end
    if note.too_deep then
        return "too_deep", string.format("it lies %d steps from the target, where the limit of depth "
            .. "ends the search", note.depth)
    end
    return "not_reached", "the search ended before its turn"
        .. (list.reason and ": " .. list.reason or ", since nothing could be cheaper than what was found")
end

local function explain(list, note)
    local made, bought = places(list, note.smiles)
    local parts, state = {}, nil
    if #made > 0 then
        parts[1], state = "made in " .. numbers(made), "made"
    end
    if #bought > 0 then
        parts[#parts + 1], state = "bought in " .. numbers(bought), state or "bought"
    end
    if note.price then parts[#parts + 1] = string.format("sold at %.2f a mole", note.price) end
    if #made == 0 then
        local why, text = unexpanded_text(list, note)
        if not why then why, text = steps_text(note) end
        parts[#parts + 1], state = text, state or why
    end
    return setmetatable({ molecule = core.mol(note.smiles), state = state, price = note.price,
        cost = note.cost, depth = note.depth, steps = note.found,
        refused = note.barred + note.disallowed, made = made, bought = bought,
        lacks = note.lacks and core.mol(note.lacks) or nil,
        text = note.smiles .. ": " .. table.concat(parts, "; ") }, answer)
end

-- answer = rs:why(molecule): molecule, state, text, and figures
function core.routes_methods.why(list, given)
    if type(given) ~= "string" and not core.is_molecule(given) then
        check.fail("why: a molecule or SMILES is expected, not a %s", type(given))
    end
    local smiles = tostring(core.mol(given))
    local note = core.route_note(list, smiles)
    if note then return explain(list, note) end
    local text = core.has_notes(list) and "the search never met it: no step that was taken in needs it"
        or "this list says nothing of its search"
    return setmetatable({ molecule = core.mol(smiles), state = "unknown", steps = 0, refused = 0, made = {},
        bought = {}, text = smiles .. ": " .. text }, answer)
end

-- list = rs:unsolved(): molecules that can neither be bought nor made, in the order of meeting
function core.routes_methods.unsolved(list)
    local answers = {}
    for i, note in ipairs(core.unsolved_notes(list)) do answers[i] = explain(list, note) end
    return answers
end

-- list = rs:transforms(): of those that did anything, each with transform tried found refused used fault
core.routes_methods.transforms = core.route_transforms
