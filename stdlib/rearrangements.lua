-- Skeletons that rearrange, double bonds that move.
-- Yields are typical ranges and sources stand from memory unless a source says otherwise.

pack {
    name = "rearrangements",
    version = "0.1.0",
    licence = "CC0-1.0",
    about = "Skeletons that rearrange, double bonds that move",
    needs = { "synthons" },
}

disconnection "benzilic-acid" {
    about = "Benzilic acid rearrangement of a 1,2-diketone",
    target = "[OX2H:1][CX4;H0:2]([c:3])([c:4])[CX3:5](=[OX1:6])[OX2H:7]",
    from = "[O:1]=[C:2]([c:3])[C:5](=[O:6])[c:4].[O:7]",
    when = function(m) return m.atom[3].symmetry == m.atom[4].symmetry end,
    conditions = "base-aq-strong",
    also_attacks = { "ester", "aldehyde", "alkyl halide" },
    recipe = "KOH, aq. EtOH, reflux; then acid",
    yield = { 75, 92 },
    cautions = { "potassium hydroxide" },
    source = "Ballard, Dehn, Org. Synth. Coll. Vol. 1, 89; from memory",
    example { "OC(C(=O)O)(c1ccccc1)c1ccccc1", from = { "O=C(C(=O)c1ccccc1)c1ccccc1", "O" } },
    example { "OC(C(=O)O)(c1ccc(C)cc1)c1ccc(C)cc1", from = { "O=C(C(=O)c1ccc(C)cc1)c1ccc(C)cc1", "O" } },
    refuse { "CC(O)(C(=O)O)c1ccccc1" }, -- one alkyl group: aldol condensation competes
}

interconversion "allylarene-isomerisation" {
    about = "Allylarene to propenylarene by base; E",
    target = "[c:1]/?[CX3;H1;!R:2]=[CX3;H1;!R:3]/?[CX4;H3:4]",
    from = "[c:1][C:2][C:3]=[C:4]",
    conditions = "base-aq-strong",
    also_attacks = { "ester", "alkyl halide", "nitrile" },
    recipe = "KOH, ethylene glycol or butanol, 150-190 °C; also: RhCl3, EtOH",
    yield = { 75, 95 },
    cautions = { "potassium hydroxide" },
    source = "common practice, no source",
    example { "COc1cc(C=CC)ccc1O", from = { "COc1cc(CC=C)ccc1O" } },
    example { "C/C=C/c1ccc2OCOc2c1", from = { "C=CCc1ccc2OCOc2c1" } },
    refuse { "CC(C)=Cc1ccccc1" }, -- a trisubstituted alkene
}

interconversion "propenylarene-cleavage" {
    about = "Aromatic aldehyde by oxidative cleavage of a propenylarene",
    target = "[c:1][CX3;H1:2]=[OX1:3]",
    from = "[c:1][C:2]=CC",
    when = function(m) return m.molecule:has "[c;$(c1(C=O)cc([OX2])c([OX2])cc1),$(c1(C=O)ccc([OX2])cc1)]" end,
    conditions = "ozone",
    also_attacks = { "other alkene", "phenol", "amine", "thioether" },
    recipe = "O3, CH2Cl2 or AcOH, then Zn or Me2S; also: nitrobenzene, NaOH, 120 °C; Na2Cr2O7",
    yield = { 60, 85 },
    source = "common practice, no source",
    example { "COc1cc(C=O)ccc1O", from = { "CC=Cc1ccc(O)c(OC)c1" } },
    example { "O=Cc1ccc2OCOc2c1", from = { "CC=Cc1ccc2OCOc2c1" } },
    refuse { "O=CCc1ccccc1" }, -- an aldehyde on a chain
}

disconnection "saucy-marbet" {
    about = "γ,δ-Unsaturated methyl ketone from a tertiary or secondary allylic alcohol and isopropenyl methyl ether (Saucy-Marbet)",
    target = "[CX4;H3:1][CX3:2](=[OX1:3])[CX4;H2:4][CX4;H2:5][CX3;H1:6]=[CX3:7]",
    from = "[C:1][C:2](=[C:4])OC.[C:5]=[C:6][C:7][O:3]",
    conditions = "heat-200",
    also_attacks = { "free acid", "acetal", "primary amine" },
    recipe = "H3PO4 (cat.), 120-180 °C under pressure; also: ethyl acetoacetate (Carroll)",
    yield = { 70, 92 },
    source = "Saucy, Marbet, Helv. Chim. Acta 1967, 50, 2091; from memory",
    example { "CC(C)=CCCC(C)=O", from = { "CC(=C)OC", "CC(C)(O)C=C" } },
    example { "CC=CCCC(C)=O", from = { "CC(=C)OC", "CC(O)C=C" } },
    refuse { "CC(=O)CCCC=C" }, -- the double bond is one carbon too far
}

interconversion "alpha-iminol" {
    about = "Ring-expanding α-iminol rearrangement of an α-hydroxy imine to an α-amino ketone",
    target = "[NX3;H1:1]([CX4:9])[CX4;H0;r6:2]([c:3])([CX4;r6:4])[CX3;r6:5](=[OX1:6])",
    from = "[N:1]([C:9])=[C:2]([c:3])[C:5]([O:6])[C:4]",
    conditions = "heat-200",
    also_attacks = { "acetal", "Boc carbamate" },
    recipe = "hydrochloride, decalin or 1,2-dichlorobenzene, 180 °C",
    yield = { 60, 85 },
    source = "Stevens, US 3254124; from memory",
    example { "CNC1(CCCCC1=O)c1ccccc1Cl", from = { "CN=C(c1ccccc1Cl)C1(O)CCCC1" } },
    example { "CNC1(CCCCC1=O)c1ccccc1", from = { "CN=C(c1ccccc1)C1(O)CCCC1" } },
    refuse { "CNC1(CCCC1=O)c1ccccc1" }, -- a five-membered ring
}

disconnection "hydroxy-imine-from-bromo-ketone" {
    about = "α-Hydroxy imine from a tertiary α-bromo ketone and a primary amine (through the epoxide)",
    target = "[NX2:1]([CX4:2])=[CX3:3]([c:4])[CX4;H0:5][OX2H:6]",
    from = "[N:1][C:2].[O:6]=[C:3]([c:4])[C:5]Br",
    conditions = "amine-rt",
    also_attacks = { "acyl halide", "aldehyde", "other ketone" },
    recipe = "liquid methylamine, -40 °C to rt",
    yield = { 60, 85 },
    source = "Stevens, US 3254124; from memory",
    example { "CN=C(c1ccccc1Cl)C1(O)CCCC1", from = { "CN", "O=C(c1ccccc1Cl)C1(Br)CCCC1" } },
    refuse { "CN=C(c1ccccc1)CO" }, -- a primary bromide is displaced instead
}

disconnection "camphene-acetate" {
    about = "Isobornyl-type acetate by Wagner-Meerwein rearrangement of an exocyclic alkene of the camphene skeleton",
    target = "[CH3:1][CX3:2](=[OX1:3])[OX2:4][CX4;H1:5]1[CX4;H2:6][CX4;H1:7]2[CX4;H2:8][CX4;H2:9][CX4;H0:10]1([CH3:11])[CX4:12]2([CH3:13])[CH3:14]",
    from = "[C:1][C:2](=[O:3])[O:4].[C:11]=[C:10]1[C:5]([C:9][C:8]2)[C:6][C:7]2[C:12]1([C:13])[C:14]",
    conditions = "acid-hot-dry",
    also_attacks = { "alcohol", "other alkene", "acetal" },
    recipe = "AcOH, 50 % H2SO4 (cat.), 50-60 °C",
    yield = { 75, 92 },
    source = "common practice, no source",
    example { "CC(=O)OC1CC2CCC1(C)C2(C)C", from = { "CC(=O)O", "C=C1C2CCC(C2)C1(C)C" } },
    refuse { "CC(=O)OC1CC2CCC1C2" }, -- no methyl groups that show the migration
}
