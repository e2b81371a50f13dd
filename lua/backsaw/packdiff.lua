-- What changed from one version of a pack to another, in words of chemistry: rules that came, went,
-- have another name, or do something else. Works on the descriptions of `study`.
local core = ...
local study = core.module "study"
local format = string.format

local function words(list)
    return list and #list > 0 and table.concat(list, ", ") or nil
end

local function percent(pair)
    return pair and pair[1] .. "-" .. pair[2] .. " %" or nil
end

local function the_end(map, synthon)
    return synthon and format("atom %d, %s", map, synthon) or nil
end

-- The self-tests as lines, to be compared as a set.
local function tests_of(one)
    local list = {}
    for i, test in ipairs(one.tests) do
        list[i] = test.refuse and "refuse " .. test.product
            or "example " .. test.product .. " from " .. table.concat(test.from, " + ")
    end
    return list
end

-- What is compared of a rule: a title and its text, nil for none.
local fields = {
    { "kind", function(r) return r.kind end },
    { "target", function(r) return r.target end },
    { "from", function(r) return r.from end },
    { "cut", function(r) return r.cut and r.cut[1] .. "-" .. r.cut[2] end },
    { "acceptor", function(r) return the_end(r.acceptor_map, r.acceptor) end },
    { "donor", function(r) return the_end(r.donor_map, r.donor) end },
    { "conditions", function(r) return r.conditions end },
    { "spares", function(r) return words(r.spares) end },
    { "also attacks", function(r) return words(r.also_attacks) end },
    { "recipe", function(r) return r.recipe end },
    { "reagents", function(r) return words(r.reagents) end },
    { "yield", function(r) return percent(r.yield) end },
    { "step cost", function(r) return r.step_cost and tostring(r.step_cost) end },
    { "cautions", function(r) return words(r.cautions) end },
    { "source", function(r) return r.source end },
    { "rxno", function(r) return r.rxno end },
    { "also", function(r) return words(r.also) end },
    { "when", function(r) return r.when and "a function" or nil end },
    { "prefer", function(r) return r.prefer and "a function" or nil end },
}

local function by_name(list)
    local map = {}
    for _, one in ipairs(list) do map[study.fold(one.name)] = one end
    return map
end

local function set_of(list)
    local set = {}
    for _, text in ipairs(list) do set[text] = true end
    return set
end

-- Lines for entries that one list has and the other lacks.
local function entries(before, after, lines, indent)
    local old, new = set_of(before), set_of(after)
    for _, text in ipairs(before) do
        if not new[text] then lines[#lines + 1] = indent .. "- " .. text end
    end
    for _, text in ipairs(after) do
        if not old[text] then lines[#lines + 1] = indent .. "+ " .. text end
    end
end

local function changes(a, b)
    local lines = {}
    if a.name ~= b.name then lines[1] = format("  name: %s -> %s", a.name, b.name) end
    for _, field in ipairs(fields) do
        local before, after = field[2](a), field[2](b)
        if before ~= after then
            lines[#lines + 1] = format("  %s: %s -> %s", field[1], before or "none", after or "none")
        end
    end
    entries(tests_of(a), tests_of(b), lines, "  ")
    return lines
end

-- A rule that does the same under another name has the same patterns and the same ends.
local function deed(one)
    return table.concat({ one.kind, one.target, one.from or "", one.acceptor or "", one.donor or "" }, "\n")
end

local function renamed(gone, came)
    local map = {}
    for _, one in ipairs(gone) do
        for i, other in ipairs(came) do
            if deed(one) == deed(other) then
                map[one] = table.remove(came, i)
                break
            end
        end
    end
    return map
end

local function only_in(list, map)
    local result = {}
    for _, one in ipairs(list) do
        if not map[study.fold(one.name)] then result[#result + 1] = one end
    end
    return result
end

local function title(one)
    return format("%s (%s)", one.name, one.from and one.target .. ">>" .. one.from
        or format("%s: %s + %s", one.target, one.acceptor, one.donor))
end

local function diff_transforms(a, b, lines)
    local old, new = by_name(a), by_name(b)
    local gone, came = only_in(a, new), only_in(b, old)
    local moved = renamed(gone, came)
    for _, one in ipairs(gone) do
        if not moved[one] then lines[#lines + 1] = "removed: " .. title(one) end
    end
    for _, one in ipairs(came) do lines[#lines + 1] = "added: " .. title(one) end
    for _, one in ipairs(a) do
        local other = new[study.fold(one.name)] or moved[one]
        local list = other and changes(one, other) or {}
        if #list > 0 then lines[#lines + 1] = (moved[one] and "renamed: " or "changed: ") .. one.name end
        table.move(list, 1, #list, #lines + 1, lines)
    end
end

-- Synthons, groups, classes: `text` gives what is compared of one.
local function diff_others(what, a, b, text, lines)
    local old, new = by_name(a), by_name(b)
    for _, one in ipairs(a) do
        local other = new[study.fold(one.name)]
        if not other then
            lines[#lines + 1] = format("removed: %s %s", what, one.name)
        elseif text(one) ~= text(other) then
            lines[#lines + 1] = format("changed: %s %s: %s -> %s", what, one.name, text(one), text(other))
        end
    end
    for _, one in ipairs(only_in(b, old)) do
        lines[#lines + 1] = format("added: %s %s: %s", what, one.name, text(one))
    end
end

-- lines = compare(old, new): none if there is no difference
return function(a, b)
    local lines = {}
    for _, field in ipairs { "name", "version", "about" } do
        if a[field] ~= b[field] then
            lines[#lines + 1] = format("%s: %s -> %s", field, a[field] or "none", b[field] or "none")
        end
    end
    diff_transforms(a.transforms, b.transforms, lines)
    diff_others("synthon", a.synthons, b.synthons, function(one)
        return one.kind .. ", " .. table.concat(one.equivalents, " ")
    end, lines)
    diff_others("group", a.groups, b.groups, function(one) return one.smarts end, lines)
    diff_others("conditions", a.conditions, b.conditions, function(one) return one.reagents or "-" end, lines)
    return lines
end
