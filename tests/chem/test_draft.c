/* Drafts: made by hand or from a molecule, changed and finished. */
#include "support/check.h"

#include <string.h>

#include "backsaw/draft.h"
#include "backsaw/format.h"

static bs_mol *read_mol(fixture *f, const char *text)
{
    bs_mol *mol;

    check_ok(f, bs_smiles_read(&f->cx, &f->home, text, strlen(text), NULL, &mol));
    return mol;
}

static char *canonical(fixture *f, const bs_mol *mol)
{
    char *out;

    check_ok(f, bs_smiles_canonical(&f->cx, &f->home, mol, 0, &out));
    return out;
}

static void draft__of_a_molecule_gives_the_molecule_again(void **state)
{
    static const char *const texts[] = {
        "C[C@H](F)/C=C/c1ccc2[nH]ccc2c1",
        "NC(Br)=[C@]=C(O)C",
        "C/C=C=C=C/C",
        "[H]/N=C/C",
        "C[S@](=O)CC",
        "C[Co@OH5](F)(Cl)(Br)(I)S",
        "[2H]C([H])([3H])C",
        "C[N+](C)(C)[O-]",
        "[Na+].[O-]C",
        "[13CH3:4]*",
        "C[C@@]12CC[C@H](C1)O2",
    };
    fixture *f = *state;

    for (size_t i = 0; i < sizeof texts / sizeof texts[0]; i++) {
        bs_mol *mol = read_mol(f, texts[i]);
        bs_draft draft;
        bs_mol *again;
        uint32_t *order;

        bs_draft_init(&draft, &f->cx, &f->home);
        check_ok(f, bs_draft_from_mol(&draft, mol));
        check_ok(f, bs_draft_finish(&draft, &f->home, &order, &again));
        assert_int_equal(bs_mol_bytes(again), bs_mol_bytes(mol));
        assert_string_equal(canonical(f, again), canonical(f, mol));
        for (int k = 0; k < bs_mol_atom_count(mol); k++) {
            assert_int_equal(order[k], k);
            assert_int_equal(bs_mol_atom_label(again, k), bs_mol_atom_label(mol, k));
        }
    }
}

/* Ester cleavage by hand: the bond goes, a hydroxyl comes, hydrogens follow the valence. */
static void draft__changes_are_perceived(void **state)
{
    fixture *f = *state;
    bs_draft draft;
    bs_mol *mol;
    uint32_t oxygen;

    bs_draft_init(&draft, &f->cx, &f->home);
    check_ok(f, bs_draft_from_mol(&draft, read_mol(f, "CC(=O)OCC")));
    draft.bonds[2].gone = true;
    draft.atoms[3].hydrogens = BS_DRAFT_IMPLIED;
    check_ok(f, bs_draft_add_atom(
                    &draft, (bs_draft_atom){.element = 8, .hydrogens = BS_DRAFT_IMPLIED}, &oxygen));
    check_ok(f, bs_draft_add_bond(&draft, 1, oxygen, 1, NULL));
    check_ok(f, bs_draft_finish(&draft, &f->home, NULL, &mol));
    assert_string_equal(canonical(f, mol), canonical(f, read_mol(f, "CC(=O)O.OCC")));
}

static void draft__atoms_that_are_gone_leave_no_trace(void **state)
{
    fixture *f = *state;
    bs_draft draft;
    bs_mol *mol;
    uint32_t *order;

    bs_draft_init(&draft, &f->cx, &f->home);
    check_ok(f, bs_draft_from_mol(&draft, read_mol(f, "N[C@@H](C)C(=O)O")));
    draft.atoms[0].gone = true;
    draft.atoms[1].hydrogens = BS_DRAFT_IMPLIED;
    check_ok(f, bs_draft_finish(&draft, &f->home, &order, &mol));
    assert_int_equal(order[0], UINT32_MAX);
    assert_int_equal(order[1], 0);
    assert_string_equal(canonical(f, mol), canonical(f, read_mol(f, "CCC(=O)O")));
}

static void draft__wrong_bonds_are_refused_at_their_atom(void **state)
{
    fixture *f = *state;
    bs_draft_atom carbon = {.element = 6, .hydrogens = BS_DRAFT_IMPLIED};
    bs_draft draft;
    bs_mol *mol;

    bs_draft_init(&draft, &f->cx, &f->home);
    for (int i = 0; i < 3; i++)
        check_ok(f, bs_draft_add_atom(&draft, carbon, NULL));
    check_ok(f, bs_draft_add_bond(&draft, 2, 2, 1, NULL));
    assert_int_equal(bs_draft_finish(&draft, &f->home, NULL, &mol), BS_EVALUE);
    assert_int_equal(f->cx.error.offset, 2);
    draft.bonds[0].gone = true;
    check_ok(f, bs_draft_add_bond(&draft, 0, 1, 1, NULL));
    check_ok(f, bs_draft_add_bond(&draft, 1, 0, 2, NULL));
    assert_int_equal(bs_draft_finish(&draft, &f->home, NULL, &mol), BS_EVALUE);
    assert_null(mol);
    draft.bonds[2].gone = true;
    check_ok(f, bs_draft_finish(&draft, &f->home, NULL, &mol));
    assert_string_equal(canonical(f, mol), canonical(f, read_mol(f, "CC.C")));
}

static void draft__a_copied_block_is_as_good(void **state)
{
    fixture *f = *state;
    bs_mol *mol = read_mol(f, "c1ccc2c(c1)C[C@H](O)CC2");
    char *wanted = canonical(f, mol);
    bs_mol *copy;

    check_ok(f, bs_mol_copy(&f->cx, &f->home, mol, &copy));
    memset(mol, 0x5a, bs_mol_bytes(copy));
    assert_string_equal(canonical(f, copy), wanted);
}

int main(void)
{
    const struct CMUnitTest tests[] = {
        check_case(draft__of_a_molecule_gives_the_molecule_again),
        check_case(draft__changes_are_perceived),
        check_case(draft__atoms_that_are_gone_leave_no_trace),
        check_case(draft__wrong_bonds_are_refused_at_their_atom),
        check_case(draft__a_copied_block_is_as_good),
    };

    return cmocka_run_group_tests(tests, NULL, NULL);
}
