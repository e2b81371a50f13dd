-- Synthons that the standard packs share: each imaginary half and the stable compounds that stand in for it.
-- Letters and numbers in comments are Seebach's (Angew. Chem. Int. Ed. Engl. 1979, 18, 239; from memory).

pack {
    name = "synthons",
    version = "0.1.0",
    licence = "CC0-1.0",
    about = "Synthons and their equivalents, shared by the standard packs",
}

-- ---- Acceptors ----------------------------------------------------------------------------

-- Alkyl cation (alkyl-a) met by a nucleophile in SN2.
synthon "alkyl" {
    kind = "acceptor",
    equivalents = {
        { attach = "Br" }, { attach = "Cl" }, { attach = "I" },
        { attach = "OS(C)(=O)=O", name = "mesylate" },
        { attach = "OS(=O)(=O)c1ccc(C)cc1", name = "tosylate" },
    },
}

-- A carbon beside an arene or a carbonyl group, which SN2 reaches also where it is secondary.
synthon "secondary halide" { kind = "acceptor", equivalents = { { attach = "Cl" }, { attach = "Br" } } }

-- Methyl cation.
synthon "methyl" {
    kind = "acceptor",
    equivalents = { { attach = "I" }, { attach = "OS(=O)(=O)OC", name = "dimethyl sulfate" } },
}

-- A carbocation that a Lewis acid or a strong acid frees.
synthon "carbocation" {
    kind = "acceptor",
    equivalents = { { attach = "Cl" }, { attach = "Br" }, { attach = "O", name = "alcohol" } },
}

-- Acylium (a1) as the acid chloride.
synthon "acyl" { kind = "acceptor", equivalents = { { attach = "Cl" } } }

-- a1 as the acid, with a coupling reagent or acid catalysis.
synthon "acyl acid" { kind = "acceptor", equivalents = { { attach = "O" } } }

-- a1 as a simple ester.
synthon "acyl methyl ester" { kind = "acceptor", equivalents = { { attach = "OC" } } }
synthon "acyl ethyl ester" { kind = "acceptor", equivalents = { { attach = "OCC" } } }
synthon "acyl simple ester" { kind = "acceptor", equivalents = { { attach = "OC" }, { attach = "OCC" } } }

-- Acetyl (a1) as acetic anhydride.
synthon "acetyl" { kind = "acceptor", equivalents = { { attach = "OC(C)=O", name = "acetic anhydride" } } }

synthon "trifluoroacetyl" {
    kind = "acceptor",
    equivalents = { { attach = "OC(=O)C(F)(F)F", name = "trifluoroacetic anhydride" } },
}

-- a1 as the phenyl ester, or of a carbamate as the phenyl carbamate.
synthon "acyl phenyl ester" { kind = "acceptor", equivalents = { { attach = "Oc1ccccc1" } } }

-- tert-Butoxycarbonyl as the dicarbonate.
synthon "tert-butoxycarbonyl" {
    kind = "acceptor",
    equivalents = { { attach = "OC(=O)OC(C)(C)C", name = "di-tert-butyl dicarbonate" } },
}

-- Formyl (a1) as N,N-dimethylformamide.
synthon "formyl" { kind = "acceptor", equivalents = { { attach = "N(C)C", name = "N,N-dimethylformamide" } } }

-- Alkoxycarbonyl as the chloroformate.
synthon "alkoxycarbonyl" { kind = "acceptor", equivalents = { { attach = "Cl" } } }

-- Carbamoyl as the isocyanate: the N-H comes from the nucleophile.
synthon "carbamoyl" {
    kind = "acceptor",
    equivalents = { { rewrite = "[C:1](=[O:3])-[NX3;H1:2]>>[C:1](=[O:3])=[N:2]", name = "isocyanate" } },
}

-- Sulfonyl as the sulfonyl chloride.
synthon "sulfonyl" { kind = "acceptor", equivalents = { { attach = "Cl" } } }

-- Hydroxyalkyl (a1) as the carbonyl compound.
synthon "hydroxyalkyl" {
    kind = "acceptor",
    equivalents = { { rewrite = "[C:1]-[OX2H:2]>>[C:1]=[O:2]", name = "carbonyl compound" } },
}

-- Alkylidene (a1): the carbonyl compound loses its oxygen as water.
synthon "alkylidene" { kind = "acceptor", equivalents = { { attach = "=O", name = "carbonyl compound" } } }

-- Carboxyl as carbon dioxide.
synthon "carboxyl" {
    kind = "acceptor",
    equivalents = { { rewrite = "[C:1](=[O:2])-[OX2H:3]>>[C:1](=[O:2])=[O:3]", name = "carbon dioxide" } },
}

-- β-Carbon of an unsaturated carbonyl compound or nitrile (a3).
synthon "beta acceptor" {
    kind = "acceptor",
    equivalents = { { rewrite = "[C:1]-[CX4;!H0:2]>>[C:1]=[C:2]", name = "Michael acceptor" } },
}

-- β-Hydroxyalkyl (a2) as the epoxide.
synthon "oxirane" {
    kind = "acceptor",
    equivalents = { { rewrite = "[C:1]-[C:2]-[OX2H:3]>>[C:1]1-[C:2]-[O:3]-1", name = "epoxide" } },
}

-- Aryl for a palladium-catalysed coupling.
synthon "aryl halide" {
    kind = "acceptor",
    equivalents = { { attach = "Br" }, { attach = "I" }, { attach = "Cl" } },
}

-- Aryl activated for nucleophilic substitution.
synthon "activated aryl" { kind = "acceptor", equivalents = { { attach = "F" }, { attach = "Cl" } } }

-- The same with one leaving group: fluorine where the nucleophile is weak, chlorine on azines.
synthon "fluoroarene" { kind = "acceptor", equivalents = { { attach = "F" } } }
synthon "aryl chloride" { kind = "acceptor", equivalents = { { attach = "Cl" } } }
synthon "chloroazine" { kind = "acceptor", equivalents = { { attach = "Cl" } } }

-- Aryl for coppers, which leave chlorides alone, and aryl that comes with boron and meets a nucleophile in air.
synthon "aryl iodide" { kind = "acceptor", equivalents = { { attach = "I" }, { attach = "Br" } } }
synthon "arylboronic acid" { kind = "acceptor", equivalents = { { attach = "B(O)O", name = "boronic acid" } } }

-- Allyl that palladium(0) ionises.
synthon "allyl acetate" { kind = "acceptor", equivalents = { { attach = "OC(C)=O" } } }

-- ---- Donors -------------------------------------------------------------------------------

-- Nucleophiles that bring the bond and lose a hydrogen.
synthon "amine" { kind = "donor", equivalents = { { attach = "[H]" } } }
synthon "amide nitrogen" { kind = "donor", equivalents = { { attach = "[H]" } } }
synthon "sulfonamide nitrogen" { kind = "donor", equivalents = { { attach = "[H]" } } }
synthon "azole" { kind = "donor", equivalents = { { attach = "[H]" } } }
synthon "alcohol" { kind = "donor", equivalents = { { attach = "[H]" } } }
synthon "phenol" { kind = "donor", equivalents = { { attach = "[H]" } } }
synthon "carboxylate" { kind = "donor", equivalents = { { attach = "[H]" } } }
synthon "thiol" { kind = "donor", equivalents = { { attach = "[H]" } } }

-- Carbon nucleophiles by loss of a proton: an arene, an enolate (d2), a carbanion between two acceptors (d2),
-- a nitronate (d1), an acetylide (d1), the end of an alkene in a Heck reaction.
synthon "arene" { kind = "donor", equivalents = { { attach = "[H]" } } }
synthon "enolate" { kind = "donor", equivalents = { { attach = "[H]" } } }
synthon "stabilised carbanion" { kind = "donor", equivalents = { { attach = "[H]" } } }
synthon "nitronate" { kind = "donor", equivalents = { { attach = "[H]" } } }
synthon "acetylide" { kind = "donor", equivalents = { { attach = "[H]" } } }
synthon "alkene" { kind = "donor", equivalents = { { attach = "[H]" } } }

-- Cyanide (d1).
synthon "cyanide" { kind = "donor", equivalents = { { attach = "[Na]", ionic = true } } }

synthon "zinc cyanide" { kind = "donor", equivalents = { { attach = "[Zn]C#N", name = "zinc cyanide" } } }
synthon "copper cyanide" { kind = "donor", equivalents = { { attach = "[Cu]", name = "copper(I) cyanide" } } }

-- Carbanions (alkyl-d, aryl-d) as metal compounds.
synthon "organomagnesium" { kind = "donor", equivalents = { { attach = "[Mg]Br", name = "Grignard reagent" } } }
synthon "organolithium" { kind = "donor", equivalents = { { attach = "[Li]" } } }
synthon "organozinc" { kind = "donor", equivalents = { { attach = "[Zn]Br", name = "organozinc bromide" } } }
synthon "organotin" {
    kind = "donor",
    equivalents = { { attach = "[Sn](CCCC)(CCCC)CCCC", name = "tributylstannane" } },
}
synthon "alkenylchromium" {
    kind = "donor",
    equivalents = { { attach = "I", name = "alkenyl iodide with chromium(II)" } },
}
synthon "organoboron" {
    kind = "donor",
    equivalents = {
        { attach = "B(O)O", name = "boronic acid" },
        { attach = "B1OC(C)(C)C(C)(C)O1", name = "pinacol boronate" },
    },
}

-- Carbanions beside phosphorus (d1), for making alkenes.
synthon "ylide" {
    kind = "donor",
    equivalents = { { attach = "=P(c1ccccc1)(c1ccccc1)c1ccccc1", name = "phosphorane" } },
}
synthon "phosphonium" {
    kind = "donor",
    equivalents = { { attach = "-[P+](c1ccccc1)(c1ccccc1)c1ccccc1.[Br-]", name = "phosphonium bromide" } },
}
synthon "phosphonate" { kind = "donor", equivalents = { { attach = "-P(=O)(OCC)OCC" } } }

-- A dialkyl phosphonate nucleophile as the trialkyl phosphite (Arbuzov).
synthon "phosphite" {
    kind = "donor",
    equivalents = { { rewrite = "[P:1]=[O:2]>>[P:1]-[O:2]CC", name = "triethyl phosphite" } },
}
