-- A pack as a page in Markdown: each rule with its patterns, examples, conditions and source.
local format = string.format

local function range(pair)
    if not pair then return nil end
    return pair[1] == pair[2] and pair[1] .. " %" or pair[1] .. "-" .. pair[2] .. " %"
end

local function code(list)
    local quoted = {}
    for i, text in ipairs(list) do quoted[i] = "`" .. text .. "`" end
    return table.concat(quoted, " + ")
end

local function words(list) return #list > 0 and table.concat(list, ", ") or nil end

local function precursors(one)
    if one.from then return "`" .. one.from .. "`" end
    return format("bond %d-%d cut; acceptor at %d: %s; donor at %d: %s", one.cut[1], one.cut[2],
        one.acceptor_map, one.acceptor, one.donor_map, one.donor)
end

local function add_rule(one, lines)
    local function item(title, text)
        if text then lines[#lines + 1] = format("- %s: %s", title, text) end
    end
    lines[#lines + 1] = format("\n### %s\n", one.name)
    item("kind", one.kind)
    item("target", "`" .. one.target .. "`")
    item("precursors", precursors(one))
    item("conditions", one.conditions)
    item("recipe", one.recipe)
    item("yield", range(one.yield))
    item("cautions", words(one.cautions))
    item("other names", words(one.also))
    for _, test in ipairs(one.tests) do
        if test.refuse then
            item("refuses", "`" .. test.product .. "`")
        else
            item("example", format("`%s` from %s", test.product, code(test.from)))
        end
    end
    item("RXNO", one.rxno)
    item("source", one.source)
end

local function add_list(title, list, text, lines)
    if #list == 0 then return end
    lines[#lines + 1] = format("\n## %s\n", title)
    for _, one in ipairs(list) do lines[#lines + 1] = format("- **%s**: %s", one.name, text(one)) end
end

-- text = page(pack): of a description by `study`
return function(pack)
    local lines = { format("# %s\n", pack.name), format("%s. Version %s.", pack.about or "A pack",
        pack.version or "none"), "\nProposals are for a trained chemist to judge; yields are typical ranges."
        .. " The supplier's safety data sheet and local rules prevail." }
    if #pack.transforms > 0 then lines[#lines + 1] = "\n## Rules" end
    for _, one in ipairs(pack.transforms) do add_rule(one, lines) end
    add_list("Synthons", pack.synthons, function(one)
        return one.kind .. "; " .. table.concat(one.equivalents, "  ")
    end, lines)
    add_list("Groups", pack.groups, function(one) return "`" .. one.smarts .. "`" end, lines)
    add_list("Classes of conditions", pack.conditions, function(one) return one.reagents or "-" end, lines)
    return table.concat(lines, "\n") .. "\n"
end
