-- Transforms: fetching by name, their fields, and their self-tests.
local core = ...
local check = core.module "check"
local methods = core.transform_type.__index
local transforms = { methods = methods } -- other modules add to them

function core.transform_type.__index(t, key)
    local method = methods[key]
    if method then return method end
    return core.describe(t)[key]
end

function transforms.all()
    local list, i = {}, 0
    while true do
        local t = core.nth_transform(i)
        if not t then return list end
        i = i + 1
        list[i] = t
    end
end

-- t = transform(name)
function transforms.fetch(name)
    if core.is_transform(name) then return name end
    if type(name) ~= "string" then
        check.fail("transform: a name is expected, not a %s", type(name))
    end
    local t = core.find_transform(name)
    if t then return t end
    local known = {}
    for i, one in ipairs(transforms.all()) do known[i] = tostring(one) end
    core.fail("not found", string.format("no transform named '%s'%s", name,
        check.meant(name, known)))
end

-- The compounds of a list of SMILES as one text: pieces sorted, each once. Salts may be written
-- as one compound or as two.
function transforms.pieces(list)
    local seen, texts = {}, {}
    for _, entry in ipairs(list) do
        for _, piece in ipairs(core.mol(entry):fragments()) do
            local text = tostring(piece)
            if not seen[text] then
                seen[text] = true
                texts[#texts + 1] = text
            end
        end
    end
    table.sort(texts)
    return table.concat(texts, " + ")
end

local pieces = transforms.pieces

local function test_one(t, test)
    local ok, product = pcall(core.mol, test.product)
    if not ok then return "the product cannot be read: " .. product.message end
    local steps = t:back(product)
    if test.refuse then
        if #steps == 0 then return end
        return string.format("%s is not refused: %s", test.product, pieces(steps[1].precursors))
    end
    local fine, wanted = pcall(pieces, test.from)
    if not fine then return "a precursor cannot be read: " .. wanted.message end
    for _, step in ipairs(steps) do
        if pieces(step.precursors) == wanted then return end
    end
    for _, step in ipairs(t:back(product, { minor = true })) do
        if step.minor and pieces(step.precursors) == wanted then
            local major = t:forth(table.unpack(step.precursors))[1]
            return string.format("%s is not the major product from %s%s", test.product, wanted,
                major and major.major and ", but " .. pieces(major.products) or "")
        end
    end
    return string.format("%s is not made from %s; %s", test.product, wanted,
        #steps == 0 and "no step" or "but from " .. pieces(steps[1].precursors))
end

-- The self-tests of a transform: a list of failures, and the number of tests.
function transforms.test(t)
    local failures, tests = {}, core.examples(core.transform_index(t))
    for _, test in ipairs(tests) do
        local ok, problem = pcall(test_one, t, test)
        if not ok then
            problem = type(problem) == "table" and problem.message or tostring(problem)
        end
        if problem then
            failures[#failures + 1] = string.format("%s: %s: %s", test.origin, tostring(t), problem)
        end
    end
    return failures, #tests
end

-- ok, failures = t:check()
function methods.check(t)
    local failures = transforms.test(t)
    return #failures == 0, failures
end

return transforms
