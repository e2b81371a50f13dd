/*
 * Descriptors. tests/data/oracle/descriptors.tsv: what RDKit 2022.09 says of 398 molecules of
 * molecules.smi.gz: Murcko scaffold, sizes of the ring systems (rings that share bonds), number of
 * different Morgan surroundings out to radius 2. Relevant cycles of cages: Vismara's paper and
 * counting by hand. Hybridisation: textbooks, from memory.
 */
#include "support/molecule.h"
#include "support/table.h"

#include <stdlib.h>

#include "backsaw/descriptor.h"

static int compare_ints(const void *a, const void *b)
{
    return *(const int *)a - *(const int *)b;
}

static void check_systems(fixture *f, const bs_mol *mol, const char *expected)
{
    bs_atom_lists systems;
    char text[400] = "-";
    int sizes[100];
    size_t used = 0;

    check_ok(f, bs_mol_ring_systems(&f->cx, &f->home, mol, &systems));
    for (int i = 0; i < systems.count; i++)
        sizes[i] = (int)(systems.offsets[i + 1] - systems.offsets[i]);
    qsort(sizes, (size_t)systems.count, sizeof *sizes, compare_ints);
    for (int i = 0; i < systems.count; i++)
        used += (size_t)snprintf(text + used, sizeof text - used, i ? ",%d" : "%d", sizes[i]);
    assert_string_equal(text, expected);
}

/*
 * C1=CC=NP(=N1)(N)N: the reference leaves a phosphorus of three bonds where two amines were, here
 * it gets hydrogens as every other atom does.
 */
static bool is_known_difference(const char *smiles)
{
    return strcmp(smiles, "C1=CC=NP(=N1)(N)N") == 0;
}

static void check_skeleton(fixture *f, const bs_mol *mol, const char *expected)
{
    bs_mol *skeleton;

    check_ok(f, bs_mol_skeleton(&f->cx, &f->home, mol, &skeleton));
    if (strcmp(expected, "-") == 0)
        assert_null(skeleton);
    else
        check_molecule(f, skeleton, expected);
}

static int count_keys(fixture *f, const bs_mol *mol)
{
    bs_surrounding *items;
    int count, different = 0;

    check_ok(f, bs_mol_surroundings(&f->cx, &f->home, mol, 2, &items, &count));
    for (int i = 0; i < count; i++)
        different += i == 0 || items[i].key != items[i - 1].key;
    return different;
}

/*
 * Of unlike surroundings with the same bonds either may stay, so that the numbers can differ by
 * one; they do for fewer than one molecule in a hundred.
 */
static void descriptors__agree_with_the_reference(void **state)
{
    static table t;
    fixture *f = *state;
    int lines = 0, different = 0;

    table_open(&t, "oracle/descriptors.tsv");
    assert_true(table_next(&t));
    while (table_next(&t)) {
        bs_mark mark = bs_arena_mark(&f->home);
        const bs_mol *mol = molecule_read(f, t.field[0]);
        int keys = count_keys(f, mol);

        if (!is_known_difference(t.field[0]))
            check_skeleton(f, mol, t.field[1]);
        check_systems(f, mol, t.field[2]);
        different += keys != atoi(t.field[3]);
        assert_true(abs(keys - atoi(t.field[3])) <= 1);
        bs_arena_rewind(&f->home, mark);
        lines++;
    }
    assert_int_equal(lines, 398);
    assert_true(different < 4);
}

static void check_rings(fixture *f, const char *smiles, int smallest, int relevant)
{
    const bs_mol *mol = molecule_read(f, smiles);
    bs_atom_lists rings;

    check_ok(f, bs_mol_relevant_rings(&f->cx, &f->home, mol, &rings));
    assert_int_equal(bs_mol_ring_count(mol), smallest);
    assert_int_equal(rings.count, relevant);
    for (int i = 0; i < rings.count; i++) {
        const uint32_t *at = rings.atoms + rings.offsets[i];
        uint32_t size = rings.offsets[i + 1] - rings.offsets[i];

        for (uint32_t k = 0; k < size; k++)
            assert_true(bs_mol_bond_between(mol, (int)at[k], (int)at[(k + 1) % size]) >= 0);
    }
}

static void rings__relevant_ones_of_cages(void **state)
{
    fixture *f = *state;

    check_rings(f, "CCO", 0, 0);
    check_rings(f, "C1CC1C1CCC1", 2, 2);
    check_rings(f, "C12C3C4C1C5C2C3C45", 5, 6); /* cubane: six faces */
    check_rings(f, "C1C2CC3CC1CC(C2)C3", 3, 4); /* adamantane */
    check_rings(f, "C1CC2CCC1CC2", 2, 3);       /* bicyclo[2.2.2]octane */
    check_rings(f, "C1CC2CCC1C2", 2, 2);        /* norbornane: the six-ring is a sum */
    check_rings(f, "C12C3C1C23", 3, 4);         /* tetrahedrane */
    check_rings(f, "c1ccc2cc3ccccc3cc2c1", 3, 3);
}

static void hybridisation__of_common_atoms(void **state)
{
    static const struct {
        const char *smiles;
        int expected;
    } atoms[] = {
        {"CC", 3},
        {"C=C", 2},
        {"C#C", 1},
        {"C=C=C", 2},
        {"c1ccccc1", 2},
        {"NC=O", 2},
        {"NC", 3},
        {"OC", 3},
        {"N#C", 1},
        {"S(C)C", 3},
        {"P(F)(F)(F)(F)F", 4},
        {"S(F)(F)(F)(F)(F)F", 5},
        {"[Na+]", 0},
        {"n1cc[nH]c1", 2},
        {"B(O)O", 2},
        {"[CH3+]", 2},
    };
    fixture *f = *state;

    for (size_t i = 0; i < sizeof atoms / sizeof *atoms; i++)
        assert_int_equal(bs_mol_atom_hybridisation(molecule_read(f, atoms[i].smiles), 0),
                         atoms[i].expected);
    assert_int_equal(bs_mol_atom_hybridisation(molecule_read(f, "C=C=C"), 1), 1);
}

static uint64_t key_of(fixture *f, const char *smiles, uint32_t a, uint32_t b, int radius)
{
    const uint32_t centres[] = {a, b};
    bs_environment e;

    check_ok(f, bs_mol_environment(&f->cx, &f->home, molecule_read(f, smiles), centres,
                                   a == b ? 1 : 2, radius, &e));
    return e.key;
}

/* Alike surroundings, as one sees from the formulas. */
static void environment__key_tells_what_lies_around(void **state)
{
    fixture *f = *state;

    assert_true(key_of(f, "CCO", 2, 2, 1) == key_of(f, "OCCC", 0, 0, 1));
    assert_true(key_of(f, "CCO", 2, 2, 3) != key_of(f, "OCCC", 0, 0, 3));
    assert_true(key_of(f, "CC(=O)OC", 1, 3, 1) == key_of(f, "COC(=O)C", 2, 1, 1));
    assert_true(key_of(f, "CC(=O)OC", 1, 3, 1) != key_of(f, "CC(=O)NC", 1, 3, 1));
}

static void environment__lists_atoms_from_near_to_far(void **state)
{
    fixture *f = *state;
    const bs_mol *mol = molecule_read(f, "CC(=O)OCC");
    const uint32_t centre = 3;
    bs_environment e;

    check_ok(f, bs_mol_environment(&f->cx, &f->home, mol, &centre, 1, 2, &e));
    assert_int_equal(e.atom_count, 6);
    assert_int_equal(e.bond_count, 5);
    assert_int_equal(e.atoms[0], 3);
    assert_int_equal(e.distances[5], 2);
    assert_int_equal(bs_mol_environment(&f->cx, &f->home, mol, &centre, 1, 11, &e), BS_ERANGE);
    assert_string_equal(f->cx.error.message, "a radius must be 0 to 10, not 11");
}

static bs_status describe(fixture *f, const bs_mol *mol, int which)
{
    const uint32_t centre = 2;
    bs_surrounding *items;
    bs_environment e;
    bs_atom_lists lists;
    bs_mol *skeleton;
    int count;

    switch (which) {
    case 0:
        return bs_mol_relevant_rings(&f->cx, &f->home, mol, &lists);
    case 1:
        return bs_mol_ring_systems(&f->cx, &f->home, mol, &lists);
    case 2:
        return bs_mol_skeleton(&f->cx, &f->home, mol, &skeleton);
    case 3:
        return bs_mol_environment(&f->cx, &f->home, mol, &centre, 1, 2, &e);
    default:
        return bs_mol_surroundings(&f->cx, &f->home, mol, 2, &items, &count);
    }
}

static void descriptors__every_failed_request_is_rolled_back(void **state)
{
    fixture *f = *state;
    const bs_mol *mol = molecule_read(f, "CC(=O)c1ccc2c(c1)CC1(CC1)C2");

    for (int which = 0; which < 5; which++) {
        size_t live = f->home.live;
        long i = 0;

        for (;; i++) {
            bs_status st;

            atomic_store(&f->cx.gate->fail_after, i);
            st = describe(f, mol, which);
            atomic_store(&f->cx.gate->fail_after, -1);
            if (st == BS_OK)
                break;
            assert_int_equal(st, BS_ENOMEM);
            assert_int_equal(f->home.live, live);
        }
        check_requests(i, 3);
    }
}

int main(void)
{
    const struct CMUnitTest tests[] = {
        check_case(descriptors__agree_with_the_reference),
        check_case(rings__relevant_ones_of_cages),
        check_case(hybridisation__of_common_atoms),
        check_case(environment__key_tells_what_lies_around),
        check_case(environment__lists_atoms_from_near_to_far),
        check_case(descriptors__every_failed_request_is_rolled_back),
    };

    return cmocka_run_group_tests(tests, NULL, NULL);
}
