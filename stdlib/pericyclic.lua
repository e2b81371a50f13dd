-- Pericyclic reactions.
-- Yields are typical ranges and sources stand from memory unless a source says otherwise.

pack {
    name = "pericyclic",
    version = "0.1.0",
    licence = "CC0-1.0",
    about = "Pericyclic reactions",
    needs = { "synthons" },
}

disconnection "diels-alder" {
    about = "Diels-Alder reaction; para/ortho rule; suprafacial: the geometry of the dienophile is kept; endo",
    rxno = "RXNO:0000006",
    target = "[CX4:1]1-[CX3:2]=[CX3:3]-[CX4;!x3:4]-[CX4;$(C-[$([CX3]=O),$(C#N),$([N+](=O)[O-])]):5]-[CX4:6]-1",
    from = "[C:1]=[C:2]-[C:3]=[C:4].[C:5]=[C:6]",
    conditions = "heat-200",
    also_attacks = { "other diene", "other activated alkene", "thiol", "primary amine" },
    recipe = "toluene, 80-140 °C; Et2AlCl or AlCl3, CH2Cl2, 0 °C",
    yield = { 65, 95 },
    source = "Clayden, Greeves, Warren, Organic Chemistry; from memory",
    example { "COC(=O)C1CCC(C)=CC1", from = { "C=CC(=C)C", "C=CC(=O)OC" } },
    refuse { "C1CCC=CC1" }, -- no activating group: ethylene does not react at ordinary temperature
}

disconnection "diels-alder-anhydride" {
    about = "Diels-Alder reaction with maleic anhydride or an imide; cis ring fusion, endo",
    rxno = "RXNO:0000006",
    target = "[CX4;!x3:1]1-[CX3:2]=[CX3:3]-[CX4;!x3:4]-[CX4:5]2-[CX3:7](=[OX1:8])-[OX2,NX3:9]-[CX3:10](=[OX1:11])-[CX4:6]-1-2",
    from = "[C:1]=[C:2]-[C:3]=[C:4].[C:5]1-[C:7](=[O:8])-[*:9]-[C:10](=[O:11])-[C:6]=1",
    conditions = "heat-200",
    also_attacks = { "other diene", "primary amine", "thiol", "free alcohol" },
    recipe = "toluene, 25-110 °C",
    yield = { 80, 98 },
    cautions = { "maleic anhydride" },
    source = "Clayden, Greeves, Warren, Organic Chemistry; from memory",
    example { "CC1=CC[C@@H]2C(=O)N(c3ccccc3)C(=O)[C@@H]2C1", from = { "C=CC(=C)C", "O=C1C=CC(=O)N1c1ccccc1" } },
    refuse { "O=C1OC(=O)C2CCCCC12" }, -- no alkene in the new ring
}
