/*
 * Bertz's complexity against complexity.json (28 molecules with the values of a reference
 * implementation of the same definition, worked out outside the project; tests/data/checks).
 */
#include "support/molecule.h"

#include <jansson.h>
#include <math.h>

#include "backsaw/mol.h"

static double complexity_of(fixture *f, const char *smiles)
{
    double value;

    check_ok(f, bs_mol_complexity(&f->cx, molecule_read(f, smiles), &value));
    return value;
}

static void complexity__is_that_of_the_reference(void **state)
{
    fixture *f = *state;
    json_error_t error;
    json_t *all = json_load_file(BACKSAW_TEST_DATA "/checks/complexity.json", 0, &error), *entry;
    size_t i;

    assert_non_null(all);
    assert_int_equal(json_array_size(json_object_get(all, "molecules")), 28);
    json_array_foreach(json_object_get(all, "molecules"), i, entry)
    {
        const char *smiles = json_string_value(json_object_get(entry, "smiles"));
        double expected = json_number_value(json_object_get(entry, "bertz"));
        double got = complexity_of(f, smiles);

        if (!(fabs(got - expected) <= 1e-5))
            fail_msg("%s: %.6f is expected, not %.6f", smiles, expected, got);
    }
    json_decref(all);
}

/* To the last bit. */
static void complexity__does_not_hang_on_the_order_of_atoms(void **state)
{
    static const char *const pairs[][2] = {
        {"CC(=O)Oc1ccccc1C(=O)O", "OC(=O)c1c(OC(C)=O)cccc1"},
        {"Cn1cnc2c1c(=O)n(C)c(=O)n2C", "O=c1n(C)c(=O)c2n(C)cnc2n1C"},
        {"CN1CCC23C4Oc5c(O)ccc(CC1C2C=CC4O)c53", "Oc1ccc2CC3N(C)CCC45C3C=CC(O)C4Oc1c25"},
    };

    for (size_t i = 0; i < sizeof pairs / sizeof *pairs; i++)
        assert_true(complexity_of(*state, pairs[i][0]) == complexity_of(*state, pairs[i][1]));
}

static void complexity__of_next_to_nothing_is_nothing(void **state)
{
    static const char *const smiles[] = {"C", "[H][H]", "[2H]C", "*", "CC", "C=C"};

    for (size_t i = 0; i < sizeof smiles / sizeof *smiles; i++)
        assert_true(complexity_of(*state, smiles[i]) == 0);
}

/* By hand from the definition: no connection, two atoms of one element or of two (2 log2 2). */
static void complexity__of_unconnected_pieces(void **state)
{
    assert_true(complexity_of(*state, "O.O") == 0);
    assert_true(fabs(complexity_of(*state, "O.N") - 2) < 1e-12);
}

/* A chain of 3000 carbon atoms, far beyond the hundred nearest; 2 n log2 n bounds the index. */
static void complexity__of_large_molecules(void **state)
{
    fixture *f = *state;
    char chain[3001];
    double value;

    memset(chain, 'C', 3000);
    chain[3000] = '\0';
    value = complexity_of(f, chain);
    assert_true(value > complexity_of(f, "CCCCCCCCCC") && value < 2.0 * 3000 * log2(3000));
}

static void complexity__every_failed_request_is_reported(void **state)
{
    fixture *f = *state;
    bs_mol *mol = molecule_read(f, "CC(=O)Oc1ccccc1C(=O)O");
    size_t used = atomic_load(&f->cx.gate->used);
    double value;
    long i = 0;

    for (;; i++) {
        bs_status st;

        atomic_store(&f->cx.gate->fail_after, i);
        st = bs_mol_complexity(&f->cx, mol, &value);
        atomic_store(&f->cx.gate->fail_after, -1);
        if (st == BS_OK)
            break;
        assert_int_equal(st, BS_ENOMEM);
        assert_true(value == 0);
        assert_int_equal(f->cx.scratch.live, 0);
        assert_true(atomic_load(&f->cx.gate->used) <= used + 65536);
    }
    check_requests(i, 4);
}

int main(void)
{
    const struct CMUnitTest tests[] = {
        check_case(complexity__is_that_of_the_reference),
        check_case(complexity__does_not_hang_on_the_order_of_atoms),
        check_case(complexity__of_next_to_nothing_is_nothing),
        check_case(complexity__of_unconnected_pieces),
        check_case(complexity__of_large_molecules),
        check_case(complexity__every_failed_request_is_reported),
    };

    return cmocka_run_group_tests(tests, NULL, NULL);
}
