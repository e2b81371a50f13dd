-- backsaw catalogue build IN... -o OUT: makes a catalogue file from lists.
local core = ...

local usage = [[
usage: backsaw catalogue build IN... -o OUT

Builds a catalogue from lists of compounds: .smi (SMILES, blank, name), .sdf, .tsv or .csv with a header
line that names its columns (smiles; optional are code, name, price_per_gram, pack_g, lead_days),
each also with .gz. A line whose structure cannot be read is counted and left out.
Exit status: 0 done, 1 failed, 2 wrong usage.]]

local function wrong(...)
    io.stderr:write("backsaw catalogue: ", string.format(...), "\n",
        "usage: backsaw catalogue build IN... -o OUT\n")
    return 2
end

local function main(...)
    local inputs, output = {}, nil
    local arguments, i = { ... }, 1
    while i <= #arguments do
        local argument = arguments[i]
        if argument == "--help" then
            print(usage)
            return 0
        elseif argument == "-o" then
            i = i + 1
            output = arguments[i]
            if not output then return wrong("-o: a file name is expected") end
        elseif string.sub(argument, 1, 1) == "-" then
            return wrong("unknown option '%s'", argument)
        else
            inputs[#inputs + 1] = argument
        end
        i = i + 1
    end
    if inputs[1] ~= "build" then
        return wrong(inputs[1] and "unknown command '%s'" or "the command 'build' is expected",
            inputs[1])
    end
    table.remove(inputs, 1)
    if #inputs == 0 then return wrong("a list of compounds is expected") end
    if not output then return wrong("-o OUT is missing") end
    local report = core.build_catalogue(inputs, output)
    if report.refused > 0 then
        io.stderr:write(string.format("backsaw: %d of %d lines left out; the first is line %d: %s\n",
            report.refused, report.lines, report.first_refused_line, report.first_refused))
    end
    print(string.format("%s: %d offers", output, report.offers))
    return report.offers > 0 and 0 or 1
end

return main
