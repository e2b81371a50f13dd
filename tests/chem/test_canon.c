/* The canonical order and the symmetry classes: properties, brute force, and known symmetries. */
#include <stdlib.h>
#include <time.h>

#include "support/check.h"
#include "support/table.h"

#include "backsaw/draft.h"
#include "backsaw/format.h"
#include "backsaw/mol.h"

/* A fixed generator (Marsaglia's xorshift64), so that every run shuffles alike. */
static uint64_t draw(uint64_t *seed)
{
    *seed ^= *seed << 13;
    *seed ^= *seed >> 7;
    *seed ^= *seed << 17;
    return *seed;
}

static bs_mol *parse(fixture *f, const char *smiles)
{
    bs_mol *mol = NULL;

    check_ok(f, bs_smiles_read(&f->cx, &f->home, smiles, strlen(smiles), NULL, &mol));
    return mol;
}

/* The same molecule with its atoms and bonds in another order. */
static bs_mol *shuffle(fixture *f, const bs_mol *mol, uint64_t *seed)
{
    bs_draft from, to;
    bs_mol *out = NULL;
    uint32_t *at, *bond;

    bs_draft_init(&from, &f->cx, &f->home);
    bs_draft_init(&to, &f->cx, &f->home);
    check_ok(f, bs_draft_from_mol(&from, mol));
    check_ok(f, bs_new(&f->cx, &f->home, from.atom_count, &at));
    check_ok(f, bs_new(&f->cx, &f->home, from.bond_count, &bond));
    for (uint32_t i = 0; i < from.atom_count; i++) {
        uint32_t k = (uint32_t)(draw(seed) % (i + 1));

        at[i] = at[k];
        at[k] = i;
    }
    for (uint32_t i = 0; i < from.bond_count; i++) {
        uint32_t k = (uint32_t)(draw(seed) % (i + 1));

        bond[i] = bond[k];
        bond[k] = i;
    }
    /* Here at[] lists old atoms by new number; the inverse is needed for bonds and stereo. */
    uint32_t *number;

    check_ok(f, bs_new(&f->cx, &f->home, from.atom_count, &number));
    for (uint32_t i = 0; i < from.atom_count; i++) {
        number[at[i]] = i;
        check_ok(f, bs_draft_add_atom(&to, from.atoms[at[i]], NULL));
    }
    for (uint32_t i = 0; i < from.bond_count; i++) {
        bs_draft_bond b = from.bonds[bond[i]];
        bool turn = draw(seed) & 1;

        check_ok(f, bs_draft_add_bond(&to, number[turn ? b.b : b.a], number[turn ? b.a : b.b],
                                      b.order, NULL));
    }
    for (uint32_t i = 0; i < from.stereo_count; i++) {
        bs_draft_stereo s = from.stereo[i];

        s.centre = number[s.centre];
        if (s.kind == BS_DRAFT_DOUBLE)
            s.second = number[s.second];
        for (int k = 0; k < 6; k++)
            if (s.around[k] < from.atom_count)
                s.around[k] = number[s.around[k]];
        check_ok(f, bs_draft_add_stereo(&to, s));
    }
    check_ok(f, bs_draft_finish(&to, &f->home, NULL, &out));
    return out;
}

static int compare_ints(const void *a, const void *b)
{
    return *(const int *)a < *(const int *)b ? -1 : *(const int *)a > *(const int *)b;
}

/* Whether sorting these numbers takes an odd number of exchanges. */
static bool is_odd(const int *number, int count)
{
    bool odd = false;

    for (int i = 0; i < count; i++)
        for (int k = 0; k < i; k++)
            odd ^= number[k] > number[i];
    return odd;
}

/* Describes the hand of an atom, or the geometry of its double bonds, by rank. */
static void describe_stereo(bs_text *text, const bs_mol *mol, int atom, const int *rank)
{
    int around[256], degree = bs_mol_atom_degree(mol, atom);
    int hand = (int)bs_mol_atom_hand(mol, atom);

    for (int k = 0; k < degree; k++) {
        int bond, geometry, ends[2] = {atom, 0}, turned = 0;

        bs_mol_neighbour(mol, atom, k, &around[k], &bond);
        ends[1] = around[k];
        around[k] = rank[around[k]];
        geometry = (int)bs_mol_bond_geometry(mol, bond);
        if (geometry == BS_GEOMETRY_NONE)
            continue;
        for (int e = 0; e < 2; e++) {
            int side[2], count = 0;

            for (int i = 0; i < bs_mol_atom_degree(mol, ends[e]) && count < 2; i++) {
                bs_mol_neighbour(mol, ends[e], i, &side[count], NULL);
                count += side[count] != ends[1 - e];
            }
            turned ^= count == 2 && rank[side[0]] > rank[side[1]];
        }
        bs_text_printf(text, "%c", (geometry == BS_GEOMETRY_CIS) ^ turned ? 'c' : 't');
    }
    if (hand != BS_HAND_NONE)
        bs_text_printf(text, "%c",
                       (hand == BS_HAND_CLOCKWISE) ^ is_odd(around, degree) ? 'R' : 'L');
}

/* The molecule as it looks in an order: independent of the code under test. */
static void describe(fixture *f, const bs_mol *mol, const int *rank, bs_text *text)
{
    int n = bs_mol_atom_count(mol), *atom_at;

    check_ok(f, bs_new(&f->cx, &f->home, n, &atom_at));
    bs_text_clear(text);
    for (int i = 0; i < n; i++) {
        assert_in_range(rank[i], 0, n - 1);
        atom_at[rank[i]] = i + 1;
    }
    for (int r = 0; r < n; r++) {
        int atom = atom_at[r] - 1, list[256], degree;

        assert_true(atom >= 0);
        degree = bs_mol_atom_degree(mol, atom);
        bs_text_printf(text, "%d.%d.%d.%d%s", bs_mol_atom_element(mol, atom),
                       bs_mol_atom_isotope(mol, atom), bs_mol_atom_charge(mol, atom),
                       bs_mol_atom_hydrogens(mol, atom),
                       bs_mol_atom_is_aromatic(mol, atom) ? "a" : "");
        for (int k = 0; k < degree; k++) {
            int to, bond;

            bs_mol_neighbour(mol, atom, k, &to, &bond);
            list[k] = rank[to] * 8 + (bs_mol_bond_is_aromatic(mol, bond)
                                          ? 5
                                          : bs_mol_bond_order(mol, bond));
        }
        qsort(list, (size_t)degree, sizeof *list, compare_ints);
        for (int k = 0; k < degree; k++)
            bs_text_printf(text, ",%d", list[k]);
        describe_stereo(text, mol, atom, rank);
        bs_text_putc(text, ';');
    }
}

static void describe_canonical(fixture *f, const bs_mol *mol, bs_text *text)
{
    int *rank;

    check_ok(f, bs_mol_canonical_order(&f->cx, &f->home, mol, &rank));
    describe(f, mol, rank, text);
}

/* Shuffles a molecule some times; every order must give the same description. */
static void check_shuffles(fixture *f, const char *smiles, int times, uint64_t *seed)
{
    bs_mark mark = bs_arena_mark(&f->home);
    bs_mol *mol = parse(f, smiles);
    bs_text first, other;

    bs_text_init(&first, &f->cx);
    bs_text_init(&other, &f->cx);
    describe_canonical(f, mol, &first);
    for (int i = 0; i < times; i++) {
        describe_canonical(f, shuffle(f, mol, seed), &other);
        if (strcmp(first.data, other.data) != 0)
            fail_msg("%s: two orders of the atoms, two canonical forms", smiles);
    }
    bs_text_free(&first);
    bs_text_free(&other);
    bs_arena_rewind(&f->home, mark);
}

/* ---- Properties ------------------------------------------------------------------------ */

/* Molecules: the oracle set; see tests/data/oracle/README.md. */
static void order__is_the_same_for_shuffled_atoms(void **state)
{
    fixture *f = *state;
    uint64_t seed = 88172645463325252u;
    table t;

    table_open(&t, "oracle/molecules.smi.gz");
    for (int i = 0; table_next(&t); i++)
        if (i % 7 == 0)
            check_shuffles(f, t.field[0], 2, &seed);
}

static void order__is_the_same_for_shuffled_cages_and_dependent_centres(void **state)
{
    /* Common structures; the cages' SMILES are from memory, their formulas were checked. */
    static const char *const list[] = {
        "C12C3C4C1C5C2C3C45",                                /* cubane */
        "C1C2CC3CC1CC(C2)C3",                                /* adamantane */
        "C12C3C4C5C1C6C7C2C8C3C9C4C1C5C6C2C7C8C9C12",        /* dodecahedrane */
        "CC(C)(C)C(C(C)(C)C)(C(C)(C)C)C(C)(C)C",
        "c1ccc(cc1)C(c1ccccc1)(c1ccccc1)c1ccccc1",
        "c1ccccc1c1c(c2ccccc2)c(c2ccccc2)c(c2ccccc2)c(c2ccccc2)c1c1ccccc1",
        "C[Si]1(C)O[Si](C)(C)O[Si](C)(C)O1",
        "OC[C@@H](O)[C@@H](O)[C@H](O)CO",
        "OC[C@@H](O)[C@H](O)[C@H](O)CO",
        "C[C@@H]1C[C@@H](C)C[C@H](C)C1",
        "C[C@@H]1C[C@H](C)C[C@H](C)C1",
        "O[C@H]1[C@H](O)[C@@H](O)[C@H](O)[C@H](O)[C@@H]1O",
        "O[C@H]1[C@H](O)[C@H](O)[C@@H](O)[C@H](O)[C@H]1O",
        "F[C@@H]1[C@@H](F)[C@H](F)[C@H]1F",
        "C[C@H]1[C@H](C(=O)O)[C@H](C)[C@H]1C(=O)O",
        "C[C@@H](O)C([C@@H](C)O)[C@@H](C)O",
        "C[C@@H](O)C([C@@H](C)O)[C@H](C)O",
        "C/C=C/C(/C=C/C)(/C=C\\C)/C=C\\C",
        "C[C@H]1CC[C@H](CC1)[C@@H]1CC[C@@H](C)CC1",
        "C1CC/C=C/CC/C=C/C1",
        "C1CC/C=C\\CC/C=C/C1",
        "[O-]S(=O)(=O)[O-].[NH4+].[NH4+].O.O.O.O.O.O",
        "CC=[C@]=CC",
    };
    fixture *f = *state;
    uint64_t seed = 2463534242u;

    for (size_t i = 0; i < sizeof list / sizeof *list; i++)
        check_shuffles(f, list[i], 40, &seed);
}

/* ---- Brute force ----------------------------------------------------------------------- */

enum { TINY = 6 };

/* A small connected molecule drawn from few kinds, so that equal ones come up often. */
static bs_mol *draw_tiny(fixture *f, uint64_t *seed)
{
    bs_draft draft;
    bs_mol *mol = NULL;
    int degree[TINY] = {0};
    uint32_t near[TINY][TINY];

    bs_draft_init(&draft, &f->cx, &f->home);
    for (uint32_t i = 0; i < TINY; i++) {
        bs_draft_atom atom = {.element = draw(seed) % 4 == 0 ? 14 : 6};

        check_ok(f, bs_draft_add_atom(&draft, atom, NULL));
    }
    for (uint32_t i = 1; i < TINY; i++) {
        for (uint32_t k = 0; k < i; k++) {
            if (k != i - 1 && draw(seed) % 3 != 0)
                continue;
            check_ok(f, bs_draft_add_bond(&draft, i, k, 1, NULL));
            near[i][degree[i]++] = k;
            near[k][degree[k]++] = i;
        }
    }
    for (uint32_t i = 0; i < TINY; i++) {
        bs_draft_stereo s = {.kind = 1, .perm = (uint8_t)(1 + (draw(seed) & 1)), .centre = i};

        if (degree[i] != 4 || draw(seed) % 4 == 0)
            continue;
        memcpy(s.around, near[i], 4 * sizeof *s.around);
        check_ok(f, bs_draft_add_stereo(&draft, s));
    }
    check_ok(f, bs_draft_finish(&draft, &f->home, NULL, &mol));
    return mol;
}

static void exchange(int *p, int i, int k)
{
    int spare = p[i];

    p[i] = p[k];
    p[k] = spare;
}

/* The next permutation in lexicographic order; false after the last. */
static bool permute(int *p, int n)
{
    int i = n - 2, k = n - 1;

    while (i >= 0 && p[i] > p[i + 1])
        i--;
    if (i < 0)
        return false;
    while (p[k] < p[i])
        k--;
    exchange(p, i, k);
    for (int a = i + 1, b = n - 1; a < b; a++, b--)
        exchange(p, a, b);
    return true;
}

/* The smallest of the descriptions in all orders. */
static void describe_by_force(fixture *f, const bs_mol *mol, bs_text *best)
{
    int order[TINY];
    bool more = true;
    bs_text text;

    bs_text_init(&text, &f->cx);
    bs_text_clear(best);
    for (int i = 0; i < TINY; i++)
        order[i] = i;
    for (; more; more = permute(order, TINY)) {
        bs_mark mark = bs_arena_mark(&f->home);

        describe(f, mol, order, &text);
        if (best->length == 0 || strcmp(text.data, best->data) < 0) {
            bs_text_clear(best);
            bs_text_puts(best, text.data);
        }
        bs_arena_rewind(&f->home, mark);
    }
    bs_text_free(&text);
}

static void order__agrees_with_brute_force(void **state)
{
    enum { COUNT = 60 };
    fixture *f = *state;
    uint64_t seed = 362436069u;
    bs_text canonical[COUNT], brute[COUNT];
    int equal = 0;

    for (int i = 0; i < COUNT; i++) {
        bs_mol *mol = draw_tiny(f, &seed);

        bs_text_init(&canonical[i], &f->cx);
        bs_text_init(&brute[i], &f->cx);
        describe_canonical(f, mol, &canonical[i]);
        describe_by_force(f, mol, &brute[i]);
        for (int k = 0; k < i; k++) {
            bool same = strcmp(brute[i].data, brute[k].data) == 0;

            equal += same;
            assert_int_equal(strcmp(canonical[i].data, canonical[k].data) == 0, same);
        }
    }
    assert_true(equal > 0);
    for (int i = 0; i < COUNT; i++) {
        bs_text_free(&canonical[i]);
        bs_text_free(&brute[i]);
    }
}

/* Joins what each automorphism connects, found by trying all orders. */
static int count_orbits_by_force(fixture *f, const bs_mol *mol, int orbit[TINY])
{
    int order[TINY], count = 0;
    bool more = true;
    bs_text own, text;

    bs_text_init(&own, &f->cx);
    bs_text_init(&text, &f->cx);
    for (int i = 0; i < TINY; i++)
        orbit[i] = order[i] = i;
    describe(f, mol, order, &own);
    for (; more; more = permute(order, TINY)) {
        bs_mark mark = bs_arena_mark(&f->home);

        describe(f, mol, order, &text);
        for (int i = 0; i < TINY && strcmp(text.data, own.data) == 0; i++) {
            int from = orbit[i], to = orbit[order[i]];

            for (int k = 0; k < TINY; k++)
                orbit[k] = orbit[k] == from ? to : orbit[k];
        }
        bs_arena_rewind(&f->home, mark);
    }
    for (int i = 0; i < TINY; i++) {
        int k = 0;

        while (orbit[k] != orbit[i])
            k++;
        count += k == i;
    }
    bs_text_free(&own);
    bs_text_free(&text);
    return count;
}

static void symmetry__agrees_with_brute_force(void **state)
{
    fixture *f = *state;
    uint64_t seed = 1597334677u;

    for (int i = 0; i < 60; i++) {
        bs_mol *mol = draw_tiny(f, &seed);
        int orbit[TINY], *classes, count = count_orbits_by_force(f, mol, orbit), highest = 0;

        check_ok(f, bs_mol_symmetry(&f->cx, &f->home, mol, &classes));
        for (int a = 0; a < TINY; a++) {
            highest = classes[a] > highest ? classes[a] : highest;
            for (int b = 0; b < TINY; b++)
                assert_int_equal(classes[a] == classes[b], orbit[a] == orbit[b]);
        }
        assert_int_equal(highest + 1, count);
    }
}

/* ---- Size and symmetry ----------------------------------------------------------------- */

static void repeat(bs_text *text, const char *piece, int times)
{
    for (int i = 0; i < times; i++)
        bs_text_puts(text, piece);
}

static void check_fast(fixture *f, const char *smiles)
{
    bs_mol *mol = parse(f, smiles);
    clock_t start = clock();
    int *rank;

    check_ok(f, bs_mol_canonical_order(&f->cx, &f->home, mol, &rank));
    /* Far above what is needed, to allow for sanitizers and busy machines. */
    assert_true(clock() - start < 20 * CLOCKS_PER_SEC);
}

static void order__large_and_symmetrical_molecules_are_fast(void **state)
{
    fixture *f = *state;
    uint64_t seed = 521288629u;
    bs_text text;

    /* C60, from memory; its formula was checked. */
    check_shuffles(f,
                   "c12c3c4c5c1c6c7c8c2c9c1c3c2c3c4c4c%10c5c5c6c6c7c7c%11c8c9c8c9c1c2c1c2c3c4c3c4"
                   "c%10c5c5c6c6c7c7c%11c8c8c9c1c1c2c3c2c4c5c6c3c7c8c1c23",
                   5, &seed);
    bs_text_init(&text, &f->cx);
    repeat(&text, "C", 4000);
    check_fast(f, text.data);
    bs_text_clear(&text);
    repeat(&text, "CC(c1ccccc1)", 150);
    check_fast(f, text.data);
    bs_text_clear(&text);
    repeat(&text, "O.", 500);
    repeat(&text, "Cc1ccccc1.", 50);
    bs_text_puts(&text, "[Na+]");
    check_fast(f, text.data);
    bs_text_clear(&text);
    repeat(&text, "C(C(C)(C)C)(C)", 200);
    check_fast(f, text.data);
    bs_text_free(&text);
}

static void symmetry__known_classes(void **state)
{
    /* Numbers of classes follow from the point groups; common practice. */
    static const struct {
        const char *smiles;
        int classes;
    } list[] = {
        {"C", 1},
        {"CC(C)(C)C", 2},
        {"Cc1ccccc1", 5},
        {"c1ccccc1", 1},
        {"c1ccc2ccccc2c1", 3},
        {"C12C3C4C1C5C2C3C45", 1},
        {"C1C2CC3CC1CC(C2)C3", 2},
        {"C12C3C4C5C1C6C7C2C8C3C9C4C1C5C6C2C7C8C9C12", 1},
        {"OC(=O)[C@H](O)[C@@H](O)C(=O)O", 5}, /* tartaric acid: a twofold axis */
        {"OC(=O)[C@H](O)[C@H](O)C(=O)O", 10}, /* meso: the ends are mirror images */
        {"OC(=O)C(O)C(O)C(=O)O", 5},
        {"O.O.[Na+].[Cl-].O", 3},
        {"Cc1ccccc1.Cc1ccccc1", 5},
        {"CC.C", 2},
        {"[CH3:1]C", 1}, /* labels take no part */
        {"C1CCCC1C1CCCC1", 3},
        {"[2H]C([2H])([2H])O", 3},
    };
    fixture *f = *state;

    for (size_t i = 0; i < sizeof list / sizeof *list; i++) {
        bs_mol *mol = parse(f, list[i].smiles);
        int *classes, highest = -1;

        check_ok(f, bs_mol_symmetry(&f->cx, &f->home, mol, &classes));
        for (int k = 0; k < bs_mol_atom_count(mol); k++)
            highest = classes[k] > highest ? classes[k] : highest;
        if (highest + 1 != list[i].classes)
            fail_msg("%s: %d classes, expected %d", list[i].smiles, highest + 1, list[i].classes);
    }
}

static void order__of_nothing_is_empty(void **state)
{
    fixture *f = *state;
    bs_draft draft;
    bs_mol *mol = NULL;
    int *rank, *classes;

    bs_draft_init(&draft, &f->cx, &f->home);
    check_ok(f, bs_draft_finish(&draft, &f->home, NULL, &mol));
    check_ok(f, bs_mol_canonical_order(&f->cx, &f->home, mol, &rank));
    check_ok(f, bs_mol_symmetry(&f->cx, &f->home, mol, &classes));
}

static void order__can_live_in_the_scratch_arena(void **state)
{
    fixture *f = *state;
    bs_mark temp = bs_arena_mark(&f->cx.scratch);
    bs_mol *mol = parse(f, "OCC");
    int *rank;

    check_ok(f, bs_mol_canonical_order(&f->cx, &f->cx.scratch, mol, &rank));
    assert_int_equal(rank[0] + rank[1] + rank[2], 0 + 1 + 2);
    bs_arena_rewind(&f->cx.scratch, temp);
}

static void order__no_memory_is_reported(void **state)
{
    fixture *f = *state;
    bs_mol *mol = parse(f, "Cc1ccc(C)cc1.O.O");
    bs_status st = BS_ENOMEM;
    int *rank;

    for (long n = 0; st != BS_OK; n++) {
        size_t live = f->home.live;

        atomic_store(&f->cx.own_gate.fail_after, n);
        st = bs_mol_canonical_order(&f->cx, &f->home, mol, &rank);
        atomic_store(&f->cx.own_gate.fail_after, -1);
        assert_true(st == BS_OK || st == BS_ENOMEM);
        assert_int_equal(f->cx.scratch.live, 0);
        if (st != BS_OK)
            assert_int_equal(f->home.live, live);
    }
}

int main(void)
{
    const struct CMUnitTest tests[] = {
        check_case(order__is_the_same_for_shuffled_atoms),
        check_case(order__is_the_same_for_shuffled_cages_and_dependent_centres),
        check_case(order__agrees_with_brute_force),
        check_case(symmetry__agrees_with_brute_force),
        check_case(order__large_and_symmetrical_molecules_are_fast),
        check_case(order__of_nothing_is_empty),
        check_case(order__can_live_in_the_scratch_arena),
        check_case(order__no_memory_is_reported),
        check_case(symmetry__known_classes),
    };

    return cmocka_run_group_tests(tests, NULL, NULL);
}
