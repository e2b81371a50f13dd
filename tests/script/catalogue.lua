-- Catalogues: building, opening, finding. Compounds and prices are invented.
local folder = os.tmpname()
os.remove(folder)
local list, out = folder .. ".tsv", folder .. ".catalogue"
local file = assert(io.open(list, "w"))
file:write("code\tname\tsmiles\tprice_per_gram_eur\tpack_g\tlead_days\n",
    "Q-1\tethanol\tOCC\t0.02\t1000\t2\n",
    "Q-2\tethanol, dry\tCCO\t0.01\t500\t7\n",
    "Q-3\tbenzyl chloride\tClCc1ccccc1\t0.3\t100\t3\n",
    "Q-4\tno structure\tC(C\t1\t1\t1\n")
file:close()

local report = catalogue.build { from = list, into = out }
print(report.offers, report.refused) --> 3	1
local shelf = catalogue.open(out)
print(#shelf, shelf:has "CCO", shelf:has(mol "c1ccccc1CCl"), shelf:has "CCN") --> 3	true	true	false
local offers = shelf:find(mol "CCO")
print(#offers, offers[1].code, offers[1].name, offers[1].price_per_gram) --> 2	Q-2	ethanol, dry	0.01
print(offers[1].container_g, offers[1].lead_days, offers[1].ground, offers[1].molecule == mol "CCO") --> 500	7	identity	true
print(#shelf:find "CCN") --> 0
print(tostring(shelf):match "3 offers$") --> 3 offers

print(fails(catalogue.open, folder .. ".none") ~= "no error") --> true
print(fails(catalogue.open, list) ~= "no error") --> true
print(fails(catalogue.build, { from = folder .. ".none", into = out }) ~= "no error", #catalogue.open(out)) --> true	3
print(fails(catalogue.build, { form = list, into = out })) --> catalogue.build: unknown field 'form'; did you mean 'from'?
print(fails(catalogue.build, { from = list })) --> catalogue.build: 'into' is missing
print(fails(catalogue.open, 7)) --> catalogue.open: a file name is expected, not a number
shelf:close()
print(fails(shelf.has, shelf, "CCO")) --> the catalogue is closed
shelf:close()
os.remove(list)
os.remove(out)
