/* Smallest sets of smallest rings. */
#include "support/check.h"

#include <string.h>

#include "backsaw/draft.h"
#include "backsaw/format.h"

/* Number of rings and sum of their sizes, counted by hand; the reference toolkit agrees. */
static const struct {
    const char *name, *smiles;
    int count;
    int total;
} cages[] = {
    {"norbornane", "C1CC2CCC1C2", 2, 10},
    {"adamantane", "C1C2CC3CC1CC(C2)C3", 3, 18},
    {"cubane", "C12C3C4C1C5C2C3C45", 5, 20},
    {"bicyclobutane", "C1C2C1C2", 2, 6},
    {"spiropentane", "C1CC12CC2", 2, 6},
    {"a bridged cubane", "C1CC2C3C4C2C5C3C1C45", 5, 23},
    {"cyclotetradecane", "C1CCCCCCCCCCCCC1", 1, 14},
    {"[2.2]paracyclophane", "C1Cc2ccc(cc2)CCc2ccc1cc2", 3, 24},
};

static void ring__cages(void **state)
{
    fixture *f = *state;

    for (size_t i = 0; i < sizeof cages / sizeof cages[0]; i++) {
        bs_mol *mol;
        int total = 0;

        check_ok(f, bs_smiles_read(&f->cx, &f->home, cages[i].smiles, strlen(cages[i].smiles), NULL,
                                   &mol));
        for (int r = 0; r < bs_mol_ring_count(mol); r++)
            total += bs_mol_ring(mol, r, NULL);
        if (bs_mol_ring_count(mol) != cages[i].count || total != cages[i].total)
            fail_msg("%s: %d rings, %d", cages[i].name, bs_mol_ring_count(mol), total);
    }
}

/* Consecutive atoms of a ring are bonded, and no atom comes twice. */
static void ring__atoms_run_around(void **state)
{
    fixture *f = *state;

    for (size_t i = 0; i < sizeof cages / sizeof cages[0]; i++) {
        bs_mol *mol;

        check_ok(f, bs_smiles_read(&f->cx, &f->home, cages[i].smiles, strlen(cages[i].smiles), NULL,
                                   &mol));
        for (int r = 0; r < bs_mol_ring_count(mol); r++) {
            const uint32_t *atoms;
            int size = bs_mol_ring(mol, r, &atoms);

            for (int k = 0; k < size; k++) {
                int bond = bs_mol_bond_between(mol, (int)atoms[k], (int)atoms[(k + 1) % size]);

                assert_true(bond >= 0);
                assert_true(bs_mol_bond_in_ring(mol, bond));
                assert_true(bs_mol_atom_in_ring(mol, (int)atoms[k]));
                for (int j = 0; j < k; j++)
                    assert_int_not_equal(atoms[j], atoms[k]);
            }
        }
    }
}

/*
 * C60 has 12 pentagons and 20 hexagons (H. W. Kroto et al., Nature 1985, 318, 162); one face is
 * the sum of the others, and a largest one is left out.
 */
static void ring__fullerene(void **state)
{
    fixture *f = *state;
    const char *c60 =
        "c12c3c4c5c1c1c6c7c2c2c8c3c3c9c4c4c%10c5c5c1c1c6c6c%11c7c2c2c7c8c3c3c8c9c4c4c9c%10"
        "c5c5c1c1c6c6c%11c2c2c7c3c3c8c4c4c9c5c1c1c6c2c3c41";
    bs_mol *mol;
    int pentagons = 0;
    int hexagons = 0;

    check_ok(f, bs_smiles_read(&f->cx, &f->home, c60, strlen(c60), NULL, &mol));
    assert_int_equal(bs_mol_atom_count(mol), 60);
    assert_int_equal(bs_mol_bond_count(mol), 90);
    for (int r = 0; r < bs_mol_ring_count(mol); r++) {
        pentagons += bs_mol_ring(mol, r, NULL) == 5;
        hexagons += bs_mol_ring(mol, r, NULL) == 6;
    }
    assert_int_equal(pentagons, 12);
    assert_int_equal(hexagons, 19);
}

/* A ladder of n four-membered rings: large systems stay cheap. */
static void ring__long_ladder(void **state)
{
    enum { RUNGS = 3000 };
    fixture *f = *state;
    bs_draft draft;
    bs_mol *mol;

    bs_draft_init(&draft, &f->cx, &f->home);
    for (uint32_t i = 0; i < 2 * RUNGS; i++) {
        check_ok(f, bs_draft_add_atom(&draft,
                                      (bs_draft_atom){.element = 6, .hydrogens = BS_DRAFT_IMPLIED},
                                      NULL));
        if (i % 2 == 1)
            check_ok(f, bs_draft_add_bond(&draft, i - 1, i, 1, NULL));
        if (i > 1)
            check_ok(f, bs_draft_add_bond(&draft, i - 2, i, 1, NULL));
    }
    check_ok(f, bs_draft_finish(&draft, &f->home, NULL, &mol));
    assert_int_equal(bs_mol_ring_count(mol), RUNGS - 1);
    for (int r = 0; r < RUNGS - 1; r++)
        assert_int_equal(bs_mol_ring(mol, r, NULL), 4);
}

int main(void)
{
    const struct CMUnitTest tests[] = {
        check_case(ring__cages),
        check_case(ring__atoms_run_around),
        check_case(ring__fullerene),
        check_case(ring__long_ladder),
    };

    return cmocka_run_group_tests(tests, NULL, NULL);
}
