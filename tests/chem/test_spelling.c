/*
 * Groups that are written with charges or without: one molecule. Which spellings mean the same is
 * what standard InChI says of each pair (InChI Technical Manual, on normalisation: mobile charges
 * and "dry" hypervalent groups; from memory), save perchlorate, which is common practice.
 */
#include "support/molecule.h"

static void spelling__with_and_without_charges_is_one_molecule(void **state)
{
    static const char *const pairs[][2] = {
        {"CN(=O)=O", "C[N+](=O)[O-]"},
        {"ON(=O)=O", "O[N+](=O)[O-]"},
        {"O=n1ccccc1", "[O-][n+]1ccccc1"},
        {"CN(C)(C)=O", "C[N+](C)(C)[O-]"},
        {"CC#N=O", "CC#[N+][O-]"},
        {"CN=N#N", "CN=[N+]=[N-]"},
        {"C[N-][N+]#N", "CN=[N+]=[N-]"},
        {"[CH2-][N+]#N", "C=[N+]=[N-]"},
        {"C=N#N", "C=[N+]=[N-]"},
        {"CS(C)=O", "C[S+](C)[O-]"},
        {"CS(C)(=O)=O", "C[S+2](C)([O-])[O-]"},
        {"CS(C)(=O)=O", "C[S+](C)(=O)[O-]"},
        {"C[Se](C)=O", "C[Se+](C)[O-]"},
        {"CP(C)(C)=O", "C[P+](C)(C)[O-]"},
        {"CP(C)(C)=S", "C[P+](C)(C)[S-]"},
        {"CP(C)(C)=NC", "C[P+](C)(C)[N-]C"},
        {"C=P(C)(C)C", "[CH2-][P+](C)(C)C"},
        {"C=S(C)C", "[CH2-][S+](C)C"},
        {"OP(O)(O)=O", "O[P+](O)(O)[O-]"},
        {"[O-]P(=O)([O-])[O-]", "[O-][P+]([O-])([O-])[O-]"},
        {"O=I(=O)c1ccccc1", "[O-][I+2]([O-])c1ccccc1"},
        {"[O-]Cl(=O)(=O)=O", "[O-][Cl+3]([O-])([O-])[O-]"},
        {"O=S=O", "[O-][S+]=O"},
        {"C[S@](=O)CC", "C[S@+]([O-])CC"},
        {"c1ccs(=O)c1", "[O-][s+]1cccc1"},
    };
    fixture *f = *state;

    for (size_t i = 0; i < sizeof pairs / sizeof *pairs; i++)
        check_molecule(f, molecule_read(f, pairs[i][0]), pairs[i][1]);
}

/* Real ions stay ions, and a choice between unlike anions is not made. */
static void spelling__ions_stay(void **state)
{
    static const char *const ions[] = {
        "C[S+](C)C.[O-]C",        "C[P+](C)(C)C.[CH3-]", "C[N+](C)(C)[CH2-]",
        "C[P+](C)(C)CC[O-]",      "[O-][N+](=O)C",       "[Na+].[S-]C",
        "F[P-](F)(F)(F)(F)F",     "C[S+](C)CC[CH2-]",    "[O-][I-][O-]",
        "C[CH-][P+](C)(C)[CH2-]",
    };
    static const int charged[] = {2, 2, 2, 2, 2, 2, 1, 2, 3, 3};
    fixture *f = *state;

    for (size_t i = 0; i < sizeof ions / sizeof *ions; i++) {
        const bs_mol *mol = molecule_read(f, ions[i]);
        int count = 0;

        for (int k = 0; k < bs_mol_atom_count(mol); k++)
            count += bs_mol_atom_charge(mol, k) != 0;
        assert_int_equal(count, charged[i]);
    }
}

/* The bond of an aryne stays where it was written; the reference toolkit keeps it too. */
static void spelling__arynes_keep_their_triple_bond(void **state)
{
    fixture *f = *state;
    const bs_mol *mol = molecule_read(f, "C1=CC=CC#C1");

    check_molecule(f, mol, "c1cccc#c1");
    assert_string_not_equal(molecule_text(f, mol),
                            molecule_text(f, molecule_read(f, "[c]1[c]cccc1")));
    assert_int_equal(bs_mol_bond_order(mol, 4), 3);
}

int main(void)
{
    const struct CMUnitTest tests[] = {
        check_case(spelling__with_and_without_charges_is_one_molecule),
        check_case(spelling__ions_stay),
        check_case(spelling__arynes_keep_their_triple_bond),
    };

    return cmocka_run_group_tests(tests, NULL, NULL);
}
