-- Explanations: why a transform fires or does not, and what could be done to a target at all.
local core = ...
local transforms = core.module "transform"

local NEAR_MISSES = 10

local function lines_of(list)
    local lines = {}
    for i, reason in ipairs(list) do
        lines[i] = reason.marked and reason.atoms[1]
            and string.format("%s  %s", reason.text, reason.marked) or reason.text
    end
    return lines
end

local why_type = {
    __metatable = false,
    __tostring = function(found)
        local lines = lines_of(found)
        table.insert(lines, 1, string.format("%s: %d step%s", found.transform, found.steps,
            found.steps == 1 and "" or "s"))
        return table.concat(lines, "\n  ")
    end,
}

-- found = t:why(m): its steps, and a list of reasons
function transforms.methods.why(t, m)
    local steps, reasons = core.why(core.transform_index(t), m)
    reasons.steps = steps
    reasons.transform = tostring(t)
    return setmetatable(reasons, why_type)
end

local idea_type = {
    __metatable = false,
    __tostring = function(list)
        local lines = {}
        for i, idea in ipairs(list) do
            lines[i] = string.format("%s%s: %s", idea.fires and "" or "(nearly) ", idea.transform,
                idea.text)
        end
        return table.concat(lines, "\n")
    end,
}

-- The transforms that fire, in the order of the rules, with the first way of each in words.
local function firing(m)
    local list, place = {}, {}
    for _, step in ipairs(core.back(m)) do
        local idea = place[step.transform]
        if not idea then
            local text = {}
            for i, precursor in ipairs(step.precursors) do text[i] = tostring(precursor) end
            idea = { transform = step.transform, fires = true, steps = 0,
                text = "from " .. table.concat(text, " + ") }
            place[step.transform] = idea
            list[#list + 1] = idea
        end
        idea.steps = idea.steps + 1
    end
    for _, idea in ipairs(list) do
        if idea.steps > 1 then
            idea.text = string.format("%s, and %d more", idea.text, idea.steps - 1)
        end
    end
    return list, place
end

-- ideas = m:ideas(): what fires, then the near misses with the largest targets first
function core.molecule_methods.ideas(m)
    local list, place = firing(m)
    local near = {}
    for index, t in ipairs(transforms.all()) do
        local name = tostring(t)
        local reason, size = nil, nil
        if not place[name] then reason, size = core.near_miss(index - 1, m) end
        if reason then
            near[#near + 1] = { transform = name, fires = false, steps = 0, text = reason.text,
                atoms = reason.atoms, marked = reason.marked, size = size, index = index }
        end
    end
    table.sort(near, function(a, b)
        if a.size ~= b.size then return a.size > b.size end
        return a.index < b.index
    end)
    for i = 1, math.min(#near, NEAR_MISSES) do
        near[i].size, near[i].index = nil, nil
        list[#list + 1] = near[i]
    end
    return setmetatable(list, idea_type)
end
