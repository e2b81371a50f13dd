/* The matcher: against a slow and obvious one, stereo, options, limits. */
#include "support/check.h"

#include <stdlib.h>

#include "backsaw/format.h"
#include "match/query.h"
#include "support/table.h"

static bs_pattern *read_pattern(fixture *f, const char *text)
{
    bs_pattern *pattern = NULL;

    check_ok(f, bs_pattern_read(&f->cx, &f->home, text, strlen(text), &pattern));
    return pattern;
}

static bs_mol *read_mol(fixture *f, const char *text)
{
    bs_mol *mol = NULL;

    check_ok(f, bs_smiles_read(&f->cx, &f->home, text, strlen(text), NULL, &mol));
    return mol;
}

static int count(fixture *f, const bs_pattern *pattern, const bs_mol *mol, bool every)
{
    bs_match_opts opts = {.every_embedding = every};
    bs_matches found;
    bool has;

    check_ok(f, bs_pattern_find(&f->cx, &f->home, pattern, mol, &opts, &found));
    check_ok(f, bs_pattern_has(&f->cx, pattern, mol, &has));
    assert_int_equal(has, found.count > 0);
    return found.count;
}

static int count_text(fixture *f, const char *smarts, const char *smiles)
{
    return count(f, read_pattern(f, smarts), read_mol(f, smiles), false);
}

/* ---- A slow matcher -------------------------------------------------------------------- */

/* Reads the post order with a pile, through the public face of the molecule only. */
static bool slow_atom_test(const bs_test *test, const bs_mol *mol, int atom)
{
    int element = bs_mol_atom_element(mol, atom), value = test->value;
    bool aromatic = bs_mol_atom_is_aromatic(mol, atom);

    switch (test->kind) {
    case BS_TEST_ANY:
        return true;
    case BS_TEST_ELEMENT:
        return element == value;
    case BS_TEST_ALIPHATIC_ELEM:
        return element == value && !aromatic;
    case BS_TEST_AROMATIC_ELEM:
        return element == value && aromatic;
    case BS_TEST_DEGREE:
        return bs_mol_atom_degree(mol, atom) == value;
    case BS_TEST_HYDROGENS:
        return bs_mol_atom_hydrogens(mol, atom) == value;
    case BS_TEST_RING_COUNT:
        assert_int_equal(value, -1);
        return bs_mol_atom_in_ring(mol, atom);
    case BS_TEST_CHARGE:
        return bs_mol_atom_charge(mol, atom) == value;
    default:
        fail_msg("the slow matcher does not know test %d", test->kind);
        return false;
    }
}

static bool slow_bond_test(const bs_test *test, const bs_mol *mol, int bond)
{
    int order = bs_mol_bond_order(mol, bond);
    bool aromatic = bs_mol_bond_is_aromatic(mol, bond);

    switch (test->kind) {
    case BS_TEST_BOND_ANY:
        return true;
    case BS_TEST_BOND_SINGLE:
        return order == 1 && !aromatic;
    case BS_TEST_BOND_DOUBLE:
        return order == 2 && !aromatic;
    case BS_TEST_BOND_AROMATIC:
        return aromatic;
    case BS_TEST_BOND_RING:
        return bs_mol_bond_in_ring(mol, bond);
    case BS_TEST_BOND_DEFAULT:
        return order == 1 || aromatic;
    default:
        fail_msg("the slow matcher does not know test %d", test->kind);
        return false;
    }
}

static bool slow_passes(const bs_query_expr *expr, const bs_mol *mol, int where)
{
    bool pile[32];
    int height = 0;

    for (int i = 0; i < expr->count; i++) {
        const bs_test *test = &expr->tests[i];

        if (test->kind == BS_TEST_NOT) {
            pile[height - 1] = !pile[height - 1];
        } else if (test->kind == BS_TEST_AND || test->kind == BS_TEST_OR) {
            bool b = pile[--height], a = pile[height - 1];
            pile[height - 1] = test->kind == BS_TEST_AND ? a && b : a || b;
        } else {
            pile[height++] = test->kind < BS_TEST_BOND_ANY ? slow_atom_test(test, mol, where)
                                                           : slow_bond_test(test, mol, where);
        }
    }
    return pile[0];
}

static int bond_between(const bs_mol *mol, int a, int b)
{
    for (int k = 0; k < bs_mol_atom_degree(mol, a); k++) {
        int other, bond;

        bs_mol_neighbour(mol, a, k, &other, &bond);
        if (other == b)
            return bond;
    }
    return -1;
}

/* Tries every atom of the molecule for each atom of the query in turn. */
static int slow_count(const bs_query *query, const bs_mol *mol, int *placed, int depth)
{
    int total = 0;

    if (depth == query->atom_count)
        return 1;
    for (int atom = 0; atom < bs_mol_atom_count(mol); atom++) {
        bool fits = slow_passes(&query->atoms[depth].expr, mol, atom);

        for (int i = 0; i < depth && fits; i++)
            fits = placed[i] != atom;
        placed[depth] = atom;
        for (int i = 0; i < query->bond_count && fits; i++) {
            int a = query->bonds[i].a, b = query->bonds[i].b, bond;

            if (a > depth || b > depth || (a != depth && b != depth))
                continue;
            bond = bond_between(mol, placed[a], placed[b]);
            fits = bond >= 0 && slow_passes(&query->bonds[i].expr, mol, bond);
        }
        if (fits)
            total += slow_count(query, mol, placed, depth + 1);
    }
    return total;
}

static unsigned draw(unsigned *seed, unsigned below)
{
    *seed = *seed * 1664525u + 1013904223u;
    return (*seed >> 16) % below;
}

/* A random pattern text of a few atoms, with branches, rings, dots and logic. */
static void random_pattern(unsigned *seed, char *text)
{
    static const char *const atoms[] = {
        "C",        "c",          "N",       "O",        "*",         "[#6]",
        "[C,N]",    "[!C]",       "[R]",     "[!R]",     "[CH2]",     "[CH3]",
        "[D2]",     "[D3;#6]",    "[#7,#8]", "[c,n;H1]", "[!#6;!H0]", "[C;H2,R]",
        "[O,N&H2]", "[+0;#6,#8]", "[!CH3]",  "[n,o]"};
    static const char *const bonds[] = {"", "", "", "-", "=", ":", "~", "@", "!@", "-,=", "!=;~"};
    int count = 1 + (int)draw(seed, 5), open = -1;

    text[0] = '\0';
    for (int i = 0; i < count; i++) {
        const char *atom = atoms[draw(seed, 22)];
        bool branch = i > 0 && i + 1 < count && draw(seed, 4) == 0;
        const char *bond = i > 0 ? bonds[draw(seed, 11)] : "";

        if (i > 0 && draw(seed, 12) == 0) {
            bond = ".";
            branch = false;
        }
        sprintf(text + strlen(text), "%s%s%s", branch ? "(" : "", bond, atom);
        if (open < 0 && i + 2 < count && !branch && draw(seed, 3) == 0) {
            strcat(text, "1");
            open = i;
        } else if (open >= 0 && i >= open + 2) {
            strcat(text, "1");
            open = -2;
        }
        if (branch)
            strcat(text, ")");
    }
}

static void find__agrees_with_a_slow_matcher(void **state)
{
    fixture *f = *state;
    table t;
    unsigned seed = 20260101;
    int pairs = 0, hits = 0, placed[8];
    char text[512];

    table_open(&t, "oracle/molecules.smi.gz");
    while (table_next(&t)) {
        bs_mark mark = bs_arena_mark(&f->home);
        bs_mol *mol = read_mol(f, t.field[0]);

        for (int i = 0; i < 8 && bs_mol_atom_count(mol) <= 14; i++) {
            bs_pattern *pattern;
            int slow;

            random_pattern(&seed, text);
            if (bs_pattern_read(&f->cx, &f->home, text, strlen(text), &pattern) != BS_OK)
                continue; /* such as a ring number left open */
            slow = slow_count(bs_pattern__query(pattern), mol, placed, 0);
            if (count(f, pattern, mol, true) != slow)
                fail_msg("%s on %s: %d, slow %d", text, t.field[0], count(f, pattern, mol, true),
                         slow);
            pairs++;
            hits += slow > 0;
        }
        bs_arena_rewind(&f->home, mark);
    }
    assert_true(pairs > 4000);
    assert_true(hits > 500);
}

/* Relaxing an expression can only add to what passes. */
static void relax__never_loses_a_match(void **state)
{
    fixture *f = *state;
    table t;
    unsigned seed = 7;
    char text[512];
    int more = 0;

    table_open(&t, "oracle/molecules.smi.gz");
    for (int i = 0; i < 600 && table_next(&t); i++) {
        bs_mark mark = bs_arena_mark(&f->home);
        bs_mol *mol = read_mol(f, t.field[0]);
        bs_pattern *pattern, *wider;
        bs_query *relaxed;
        int before, after;

        random_pattern(&seed, text);
        if (bs_pattern_read(&f->cx, &f->home, text, strlen(text), &pattern) == BS_OK) {
            check_ok(f, bs_query_relax(&f->cx, &f->home, bs_pattern__query(pattern),
                                       1u << draw(&seed, 9), &relaxed));
            check_ok(f, bs_query_compile(&f->cx, &f->home, relaxed, &wider));
            before = count(f, pattern, mol, true);
            after = count(f, wider, mol, true);
            assert_true(before <= after);
            more += before < after;
        }
        bs_arena_rewind(&f->home, mark);
    }
    gzclose(t.file);
    assert_true(more > 20);
}

/* ---- Stereo ---------------------------------------------------------------------------- */

/*
 * A SMILES read as SMARTS asks for the hands and geometries that it writes. Pairs of SMILES of
 * one molecule must find each other, enantiomers and the like must not. Verdicts: see
 * tests/data/oracle/README.md; pairs that do not find themselves (marks that mean nothing,
 * hydrogens as atoms, allenes and classes other than tetrahedral, for which patterns cannot ask)
 * say nothing here.
 */
static void stereo__pairs_find_each_other_or_not(void **state)
{
    fixture *f = *state;
    table t;
    int same = 0, different = 0;

    table_open(&t, "oracle/stereo.tsv");
    table_next(&t);
    while (table_next(&t)) {
        bs_mol *mol[2];
        bs_pattern *pattern[2];
        bool told = true, found;

        for (int i = 0; i < 2 && told; i++)
            told = bs_smiles_read(&f->cx, &f->home, t.field[2 + i], strlen(t.field[2 + i]), NULL,
                                  &mol[i]) == BS_OK &&
                   bs_pattern_read(&f->cx, &f->home, t.field[2 + i], strlen(t.field[2 + i]),
                                   &pattern[i]) == BS_OK &&
                   count(f, pattern[i], mol[i], false) > 0;
        if (!told)
            continue;
        found = count(f, pattern[0], mol[1], false) > 0 && count(f, pattern[1], mol[0], false) > 0;
        if (found != (strcmp(t.field[4], "same") == 0))
            fail_msg("%s: %s and %s are %s", t.field[0], t.field[2], t.field[3], t.field[4]);
        *(found ? &same : &different) += 1;
    }
    print_message("%d same, %d different\n", same, different);
    assert_true(same > 30);
    assert_true(different > 30);
}

/* From the definition of @ in the OpenSMILES specification. */
static void hand__is_seen_in_the_order_of_the_pattern(void **state)
{
    static const struct {
        const char *smarts, *smiles;
        int count;
    } cases[] = {
        {"[C@](F)(Cl)Br", "[C@H](F)(Cl)Br", 1},
        {"[C@](F)(Cl)Br", "[C@@H](F)(Cl)Br", 0},
        {"[C@@?](F)(Cl)Br", "[C@H](F)(Cl)Br", 0},
        {"[C@@?](F)(Cl)Br", "C(F)(Cl)Br", 1},
        {"[C@](F)(Cl)Br", "C(F)(Cl)Br", 0},
        {"[!@](F)(Cl)Br", "[C@@H](F)(Cl)Br", 1},
        {"[!@](F)(Cl)Br", "[C@H](F)(Cl)Br", 0},
        {"[@,N](F)(Cl)Br", "[C@@H](F)(Cl)Br", 0},
        {"F[C@](Cl)(Br)I", "I[C@](F)(Cl)Br", 0},
        {"F[C@](Cl)(Br)I", "I[C@@](F)(Cl)Br", 1},
        {"F[C@H](Cl)", "F[C@H](Cl)Br", 1},
        {"F[C@@H](Cl)", "F[C@H](Cl)Br", 1},
        {"C[S@](=O)c", "C[S@](=O)c1ccccc1", 1},
        {"C[S@@](=O)c", "C[S@](=O)c1ccccc1", 0},
        {"[$([C@H](F)(Cl)Br)]", "[C@H](F)(Cl)Br", 1},
        {"[$([C@@H](F)(Cl)Br)]", "[C@H](F)(Cl)Br", 0},
        {"[!$([C@@H](F)(Cl)Br);C]", "[C@H](F)(Cl)Br", 1},
    };
    fixture *f = *state;

    for (size_t i = 0; i < sizeof cases / sizeof *cases; i++)
        if (count_text(f, cases[i].smarts, cases[i].smiles) != cases[i].count)
            fail_msg("%s on %s is not %d", cases[i].smarts, cases[i].smiles, cases[i].count);
}

static void geometry__goes_with_the_marks(void **state)
{
    static const struct {
        const char *smarts, *smiles;
        int count;
    } cases[] = {
        {"F/C=C/F", "F/C=C/F", 1},
        {"F/C=C/F", "F/C=C\\F", 0},
        {"F/C=C/F", "FC=CF", 0},
        {"F/C=C/?F", "FC=CF", 1},
        {"F/C=C/?F", "F/C=C\\F", 0},
        {"C(\\F)=C/F", "F/C=C/F", 1},
        {"F\\C=C\\F", "F/C=C/F", 1},
        {"F/C=CF", "FC=CF", 1},
        {"F/C=C/C=C\\F", "F/C=C/C=C\\F", 1},
        {"F/C=C/C=C/F", "F/C=C/C=C\\F", 0},
        {"F/C(Cl)=C/F", "Cl/C(F)=C\\F", 1},
        {"F/C(Cl)=C/F", "Cl/C(F)=C/F", 0},
        {"C/C", "CC", 1},
        {"F/C~C/F", "F/C=C\\F", 1},
    };
    fixture *f = *state;

    for (size_t i = 0; i < sizeof cases / sizeof *cases; i++)
        if (count_text(f, cases[i].smarts, cases[i].smiles) != cases[i].count)
            fail_msg("%s on %s is not %d", cases[i].smarts, cases[i].smiles, cases[i].count);
}

/* ---- Single tests ---------------------------------------------------------------------- */

static void atoms__tests_that_the_reference_set_leaves_out(void **state)
{
    static const struct {
        const char *smarts, *smiles;
        int count;
    } cases[] = {
        {"[H]", "[2H]C([2H])O", 2},
        {"[2H]C", "[2H]C([2H])O", 2},
        {"[CH3]", "[2H]C([2H])O", 1},
        {"[CH3]", "[2H]CO", 1},
        {"[CH2]", "[2H]CO", 0},
        {"[Ch2]", "[2H]CO", 1},
        {"[CD2]", "[2H]CO", 1},
        {"[h]", "C", 1},
        {"[h]", "C(F)(F)(F)F", 0},
        {"[^1]", "C#N", 2},
        {"[^2]", "C=CC", 2},
        {"[^3]", "C=CC", 1},
        {"[^2]", "CC(=O)NC", 3},
        {"[^2]", "c1cc[nH]c1", 5},
        {"[^3]", "CCO", 3},
        {"[^1]", "C=C=C", 1},
        {"[#0]", "*C", 1},
        {"*", "*C", 2},
        {"[0*]", "[13CH3]C", 1},
        {"[r300]", "C1CC1", 0},
        {"[H300]", "C", 0},
        {"[v300]", "C", 0},
        {"[-15]", "C", 0},
        {"([#6].[#8])", "CO", 1},
        {"([#6]).([#8])", "CO", 0},
        {"([#6]).([#8])", "C.O", 1},
        {"([#6].[#8])", "C.O", 0},
        {"[#6].[#8]", "C.O", 1},
        {"[Na+].[Cl-]", "[Na+].[Cl-]", 1},
    };
    fixture *f = *state;

    for (size_t i = 0; i < sizeof cases / sizeof *cases; i++)
        if (count_text(f, cases[i].smarts, cases[i].smiles) != cases[i].count)
            fail_msg("%s on %s is not %d", cases[i].smarts, cases[i].smiles, cases[i].count);
}

static void passes__one_atom_and_one_bond(void **state)
{
    fixture *f = *state;
    bs_pattern *pattern = read_pattern(f, "[C;$(CO);H2][F,Cl]");
    bs_mol *mol = read_mol(f, "OCC=O");
    bool yes;

    check_ok(f, bs_pattern__atom_passes(&f->cx, pattern, 0, mol, 1, &yes));
    assert_true(yes);
    check_ok(f, bs_pattern__atom_passes(&f->cx, pattern, 0, mol, 2, &yes));
    assert_false(yes);
    check_ok(f, bs_pattern__atom_passes(&f->cx, pattern, 1, mol, 0, &yes));
    assert_false(yes);
    assert_true(bs_pattern__bond_passes(pattern, 0, mol, 1));
    assert_false(bs_pattern__bond_passes(pattern, 0, mol, 2));
}

/* ---- Options --------------------------------------------------------------------------- */

static void find__options_narrow_the_answer(void **state)
{
    fixture *f = *state;
    bs_pattern *pattern = read_pattern(f, "cc");
    bs_mol *benzene = read_mol(f, "c1ccccc1");
    bs_matches found;
    bs_match_opts opts = {.every_embedding = true};

    check_ok(f, bs_pattern_find(&f->cx, &f->home, pattern, benzene, NULL, &found));
    assert_int_equal(found.count, 6);
    assert_int_equal(found.width, 2);
    check_ok(f, bs_pattern_find(&f->cx, &f->home, pattern, benzene, &opts, &found));
    assert_int_equal(found.count, 12);
    opts.limit = 5;
    check_ok(f, bs_pattern_find(&f->cx, &f->home, pattern, benzene, &opts, &found));
    assert_int_equal(found.count, 5);
    opts = (bs_match_opts){.anchored = true, .anchor_atom = 1, .anchor = 4};
    check_ok(f, bs_pattern_find(&f->cx, &f->home, pattern, benzene, &opts, &found));
    assert_int_equal(found.count, 2);
    for (int i = 0; i < 2; i++)
        assert_int_equal(found.atoms[2 * i + 1], 4);
    opts.anchor = 6;
    assert_int_equal(bs_pattern_find(&f->cx, &f->home, pattern, benzene, &opts, &found), BS_ERANGE);
}

/* An anchored search finds what a search of all finds there. */
static void find__anchored_is_a_part_of_all(void **state)
{
    fixture *f = *state;
    bs_pattern *pattern = read_pattern(f, "[#6]~[#6](~*)~[#7,#8].*");
    bs_mol *mol = read_mol(f, "CC(=O)Nc1ccc(O)cc1.[Na+].[Cl-]");
    bs_match_opts opts = {.every_embedding = true};
    bs_matches all, some;
    int sum = 0;

    check_ok(f, bs_pattern_find(&f->cx, &f->home, pattern, mol, &opts, &all));
    opts.anchored = true;
    for (opts.anchor_atom = 0; opts.anchor_atom < 5; opts.anchor_atom++)
        for (opts.anchor = 0; opts.anchor < 13; opts.anchor++) {
            check_ok(f, bs_pattern_find(&f->cx, &f->home, pattern, mol, &opts, &some));
            sum += some.count;
        }
    assert_true(all.count > 0);
    assert_int_equal(sum, 5 * all.count);
}

static void find__result_may_live_in_scratch(void **state)
{
    fixture *f = *state;
    bs_mark temp = bs_arena_mark(&f->cx.scratch);
    bs_pattern *pattern;
    bs_mol *mol = read_mol(f, "CCO");
    bs_matches found;

    check_ok(f, bs_pattern_read(&f->cx, &f->cx.scratch, "[C;$(CO)]O", 10, &pattern));
    check_ok(f, bs_pattern_find(&f->cx, &f->cx.scratch, pattern, mol, NULL, &found));
    assert_int_equal(found.count, 1);
    assert_int_equal(found.atoms[0], 1);
    assert_int_equal(found.atoms[1], 2);
    bs_arena_rewind(&f->cx.scratch, temp);
}

/* ---- Limits ---------------------------------------------------------------------------- */

static bs_mol *read_fullerene_like(fixture *f)
{
    return read_mol(f, "C12C3C4C5C1C6C7C2C8C3C9C4C%10C5C6C%11C7C8C9C%10%11");
}

static void find__stops_at_the_step_budget(void **state)
{
    fixture *f = *state;
    bs_pattern *pattern = read_pattern(f, "*~*~*~*~*~*~*~*~*~*~*~*~*~*~*~*~*~*~*~[#7]");
    bs_mol *mol = read_mol(f, "NC12C3C4C5C1C6C7C2C8C3C9C4C%10C5C6C%11C7C8C9C%10%11");
    bs_match_opts opts = {.steps = 1000};
    bs_matches found;

    assert_int_equal(bs_pattern_find(&f->cx, &f->home, pattern, mol, &opts, &found), BS_ELIMIT);
    assert_int_equal(found.count, 0);
    assert_non_null(strstr(f->cx.error.message, "too many steps"));
}

static void find__stops_when_told(void **state)
{
    fixture *f = *state;
    bs_pattern *pattern = read_pattern(f, "*~*~*~*~*~*~*~*~*~*~*~*~*~*");
    bs_mol *mol = read_fullerene_like(f);
    bs_matches found;

    atomic_store(f->cx.stop, true);
    assert_int_equal(bs_pattern_find(&f->cx, &f->home, pattern, mol, NULL, &found), BS_ESTOPPED);
    atomic_store(f->cx.stop, false);
}

/*
 * Each level asks for two matches of the one below: 2^40 of them without a memory of what was
 * found, a few thousand steps with it.
 */
static void recursion__is_remembered(void **state)
{
    fixture *f = *state;
    char text[512];
    size_t length = 0;
    bs_match_opts opts = {.steps = 100000};
    bs_matches found;
    bs_mol *mol = read_mol(f, "CCCCCCCCCCCCCCCCCCCC");

    for (int i = 0; i < 40; i++)
        length += (size_t)sprintf(text + length, "[$(*~");
    text[length++] = 'C';
    for (int i = 0; i < 40; i++)
        length += (size_t)sprintf(text + length, ")]");
    check_ok(f, bs_pattern_find(&f->cx, &f->home, read_pattern(f, text), mol, &opts, &found));
    assert_int_equal(found.count, 20);
}

static void find__a_long_chain_is_found(void **state)
{
    fixture *f = *state;
    static char text[2001];
    bs_pattern *pattern;
    bs_mol *mol;

    memset(text, 'C', 2000);
    check_ok(f, bs_pattern_read(&f->cx, &f->home, text, 2000, &pattern));
    mol = read_mol(f, text);
    assert_int_equal(count(f, pattern, mol, true), 2);
}

static void find__every_failed_allocation_is_rolled_back(void **state)
{
    fixture *f = *state;
    bs_pattern *pattern = read_pattern(f, "([C;$(C=O)]~*).([#7])");
    bs_mol *mol = read_mol(f, "CC(=O)OC([2H])C(=O)N.NCCN");
    size_t live = f->home.live;
    bs_matches found;
    bs_status st = BS_ENOMEM;
    long n = 0;

    for (; st != BS_OK && n < 1000; n++) {
        atomic_store(&f->cx.gate->fail_after, n);
        st = bs_pattern_find(&f->cx, &f->home, pattern, mol, NULL, &found);
        if (st != BS_OK) {
            assert_int_equal(st, BS_ENOMEM);
            assert_int_equal(f->home.live, live);
            assert_int_equal(f->cx.scratch.live, 0);
        }
    }
    atomic_store(&f->cx.gate->fail_after, -1);
    check_ok(f, st);
    check_requests(n, 4);
    assert_true(found.count > 0);
}

int main(void)
{
    const struct CMUnitTest tests[] = {
        check_case(find__agrees_with_a_slow_matcher),
        check_case(relax__never_loses_a_match),
        check_case(stereo__pairs_find_each_other_or_not),
        check_case(hand__is_seen_in_the_order_of_the_pattern),
        check_case(geometry__goes_with_the_marks),
        check_case(atoms__tests_that_the_reference_set_leaves_out),
        check_case(passes__one_atom_and_one_bond),
        check_case(find__options_narrow_the_answer),
        check_case(find__anchored_is_a_part_of_all),
        check_case(find__result_may_live_in_scratch),
        check_case(find__stops_at_the_step_budget),
        check_case(find__stops_when_told),
        check_case(recursion__is_remembered),
        check_case(find__a_long_chain_is_found),
        check_case(find__every_failed_allocation_is_rolled_back),
    };

    return cmocka_run_group_tests_name("match.match", tests, NULL, NULL);
}
