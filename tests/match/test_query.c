/*
 * Reading, writing and relaxing SMARTS. How doubtful forms are read follows RDKit 2022.09.3
 * (asked for by hand), which reads each of them as stated here.
 */
#include "support/check.h"

#include "backsaw/format.h"
#include "match/query.h"
#include "support/table.h"

static bs_query *read_query(fixture *f, const char *text)
{
    bs_query *query = NULL;

    check_ok(f, bs_query_read(&f->cx, &f->home, text, strlen(text), 0, &query));
    return query;
}

static const char *write_query(fixture *f, const bs_query *query)
{
    char *text = NULL;

    check_ok(f, bs_query_write(&f->cx, &f->home, query, &text));
    return text;
}

/* ---- Reading --------------------------------------------------------------------------- */

static void read__hydrogen_is_an_atom_or_a_count(void **state)
{
    static const char *const atoms[] = {"[H]", "[2H]", "[H+]", "[H-]", "[H:3]", "[3H+:1]", "[H+2]"};
    static const char *const counts[] = {"[H1]",  "[*H]", "[H,Cl]", "[!H]",
                                         "[H;+]", "[HH]", "[+H]",   "[2H1]"};
    fixture *f = *state;

    for (size_t i = 0; i < sizeof atoms / sizeof *atoms; i++) {
        bs_query *query = read_query(f, atoms[i]);

        assert_true(bs_query_mentions(&query->atoms[0].expr, BS_TEST_ELEMENT));
        assert_false(bs_query_mentions(&query->atoms[0].expr, BS_TEST_HYDROGENS));
    }
    for (size_t i = 0; i < sizeof counts / sizeof *counts; i++) {
        bs_query *query = read_query(f, counts[i]);

        assert_false(bs_query_mentions(&query->atoms[0].expr, BS_TEST_ELEMENT));
        assert_true(bs_query_mentions(&query->atoms[0].expr, BS_TEST_HYDROGENS));
    }
}

/* The forms on the right are RDKit's way of writing what it read. */
static void read__letter_pairs_and_defaults(void **state)
{
    static const char *const pairs[][2] = {
        {"[Nh]", "[N&h]"},     {"[Nh1]", "[N&h1]"},    {"[Cn]", "[Cn]"},
        {"[se]", "[se]"},      {"[te]", "[te]"},       {"[Sr]", "[Sr]"},
        {"[D]", "[D1]"},       {"[CH]", "[C&H1]"},     {"[CH-]", "[C&H1&-]"},
        {"[#6;H]", "[#6&H1]"}, {"[X]", "[X1]"},        {"[v]", "[v1]"},
        {"[R]", "[R]"},        {"[r5]", "[r5]"},       {"[x]", "[x]"},
        {"[h]", "[h]"},        {"[++]", "[+2]"},       {"[---]", "[-3]"},
        {"[+0]", "[+0]"},      {"[12]", "[12]"},       {"[!!C]", "[!!C]"},
        {"[C:7]", "[C:7]"},    {"[^2]", "[^2]"},       {"[C@@?]", "[C&@@?]"},
        {"[as]", "[as]"},      {"[Cl;+0]", "[Cl&+0]"}, {"[OX2H]", "[O&X2&H1]"},
    };
    fixture *f = *state;

    for (size_t i = 0; i < sizeof pairs / sizeof *pairs; i++)
        assert_string_equal(write_query(f, read_query(f, pairs[i][0])), pairs[i][1]);
}

static void read__logic_binds_not_and_or_and(void **state)
{
    fixture *f = *state;
    const bs_query_expr *expr = &read_query(f, "[!C,N&R;+]")->atoms[0].expr;
    static const int kinds[] = {BS_TEST_ALIPHATIC_ELEM, BS_TEST_NOT, BS_TEST_ALIPHATIC_ELEM,
                                BS_TEST_RING_COUNT,     BS_TEST_AND, BS_TEST_OR,
                                BS_TEST_CHARGE,         BS_TEST_AND};

    assert_int_equal(expr->count, 8);
    for (int i = 0; i < 8; i++)
        assert_int_equal(expr->tests[i].kind, kinds[i]);
}

static void read__errors_tell_place_and_want(void **state)
{
    static const struct {
        const char *text;
        long offset;
        const char *says;
    } cases[] = {
        {"", 0, "expected an atom, found the end"},
        {"C(C", 1, "'(' is never closed"},
        {"CC)C", 2, "')' closes nothing"},
        {"C[NX3", 1, "'[' is never closed"},
        {"C[#x]", 3, "expected an atomic number"},
        {"C1CC", 1, "used once"},
        {"C11", 2, "to itself"},
        {"C1C1", 3, "second bond"},
        {"C=1CC-1", 6, "different bonds"},
        {"[C@](F)(Cl)(Br)(I)O", 0, "more than four neighbours"},
        {"[C@@H](F)(Cl)(Br)I", 0, "four neighbours and a hydrogen"},
        {"[C@AL1]", 3, "tetrahedral"},
        {"[$(C", 1, "is never closed"},
        {"[$(C]", 4, "expected an atom, found ']'"},
        {"[C:99999]", 3, "above 32767"},
        {"[C+16]", 3, "above 15"},
        {"[D1000]", 2, "above 999"},
        {"[#119]", 2, "above 118"},
        {"(C)C", 3, "behind a group"},
        {"((C))", 1, "expected an atom"},
        {"C(.C)C", 2, "expected an atom"},
        {"C%1", 2, "two digits"},
        {"C\xC3\xA4", 1, "byte 0xC3"},
        {"CC ", 2, "found ' '"},
    };
    fixture *f = *state;

    for (size_t i = 0; i < sizeof cases / sizeof *cases; i++) {
        bs_query *query = NULL;
        bs_status st =
            bs_query_read(&f->cx, &f->home, cases[i].text, strlen(cases[i].text), 100, &query);

        if (st != BS_ESYNTAX && st != BS_EVALUE)
            fail_msg("%s is not refused", cases[i].text);
        if (f->cx.error.offset != cases[i].offset + 100)
            fail_msg("%s: offset %ld", cases[i].text, f->cx.error.offset - 100);
        if (!strstr(f->cx.error.message, cases[i].says))
            fail_msg("%s: %s", cases[i].text, f->cx.error.message);
    }
}

static void read__nul_is_no_end(void **state)
{
    fixture *f = *state;
    bs_query *query;

    assert_int_equal(bs_query_read(&f->cx, &f->home, "C\0C", 3, 0, &query), BS_ESYNTAX);
    assert_int_equal(f->cx.error.offset, 1);
    assert_int_equal(bs_query_read(&f->cx, &f->home, "[C\0]", 4, 0, &query), BS_ESYNTAX);
}

/* A carbon in `depth` recursions. */
static bs_status read_nested(fixture *f, int depth)
{
    char text[1024];
    size_t length = 0;
    bs_pattern *pattern;

    for (int i = 0; i < depth; i++)
        length += (size_t)sprintf(text + length, "[$(");
    text[length++] = 'C';
    for (int i = 0; i < depth; i++)
        length += (size_t)sprintf(text + length, ")]");
    return bs_pattern_read(&f->cx, &f->home, text, length, &pattern);
}

static void read__depth_and_size_are_bounded(void **state)
{
    fixture *f = *state;
    static char text[BS_QUERY_MAX_TEXT + 2];
    bs_query *query;

    check_ok(f, read_nested(f, BS_QUERY_MAX_DEPTH));
    assert_int_equal(read_nested(f, BS_QUERY_MAX_DEPTH + 1), BS_ELIMIT);
    memset(text, 'C', sizeof text);
    check_ok(f, bs_query_read(&f->cx, &f->home, text, BS_QUERY_MAX_ATOMS, 0, &query));
    assert_int_equal(bs_query_read(&f->cx, &f->home, text, BS_QUERY_MAX_ATOMS + 1, 0, &query),
                     BS_ELIMIT);
    assert_int_equal(bs_query_read(&f->cx, &f->home, text, sizeof text, 0, &query), BS_ELIMIT);
    memset(text, '!', sizeof text);
    text[0] = '[';
    assert_int_equal(bs_query_read(&f->cx, &f->home, text, BS_QUERY_MAX_TEXT, 0, &query),
                     BS_ESYNTAX);
    memset(text, '(', sizeof text);
    text[0] = 'C';
    assert_int_equal(bs_query_read(&f->cx, &f->home, text, BS_QUERY_MAX_TEXT, 0, &query),
                     BS_ESYNTAX);
}

static void read__neighbours_of_a_centre_stand_in_order(void **state)
{
    fixture *f = *state;
    const bs_query *q = read_query(f, "F[C@H](Cl)Br");
    static const int first[] = {0, -1, 2, 3}, ring[] = {0, -1, 5, 2};

    assert_int_equal(q->atoms[1].around_count, 4);
    assert_memory_equal(q->atoms[1].around, first, sizeof first);
    assert_int_equal(q->atoms[0].around_count, 0);
    q = read_query(f, "F[C@]1CCCC1");
    assert_int_equal(q->atoms[1].around_count, 4);
    assert_memory_equal(q->atoms[1].around, ring, sizeof ring);
}

/* ---- Writing --------------------------------------------------------------------------- */

static bool same_expr(const bs_query_expr *a, const bs_query_expr *b)
{
    if (a->count != b->count)
        return false;
    for (int i = 0; i < a->count; i++)
        if (a->tests[i].kind != b->tests[i].kind || a->tests[i].value != b->tests[i].value)
            return false;
    return true;
}

/* A bond that is written at the second of its ring numbers may move to the first. */
static bool same_bond(const bs_query_bond *a, const bs_query_bond *b)
{
    bool directed = bs_query_mentions(&a->expr, BS_TEST_BOND_UP) ||
                    bs_query_mentions(&a->expr, BS_TEST_BOND_DOWN);

    if (!same_expr(&a->expr, &b->expr))
        return false;
    return (a->a == b->a && a->b == b->b) || (!directed && a->a == b->b && a->b == b->a);
}

static bool same_query(const bs_query *a, const bs_query *b)
{
    if (a->atom_count != b->atom_count || a->bond_count != b->bond_count ||
        a->sub_count != b->sub_count)
        return false;
    for (int i = 0; i < a->atom_count; i++)
        if (!same_expr(&a->atoms[i].expr, &b->atoms[i].expr) ||
            a->atoms[i].map != b->atoms[i].map || a->atoms[i].component != b->atoms[i].component ||
            a->atoms[i].around_count != b->atoms[i].around_count ||
            (a->atoms[i].around_count > 0 &&
             memcmp(a->atoms[i].around, b->atoms[i].around,
                    (size_t)a->atoms[i].around_count * sizeof(int)) != 0))
            return false;
    for (int i = 0; i < a->bond_count; i++)
        if (!same_bond(&a->bonds[i], &b->bonds[i]))
            return false;
    for (int i = 0; i < a->sub_count; i++)
        if (!same_query(a->subs[i], b->subs[i]))
            return false;
    return true;
}

static void write__oracle_patterns_read_as_the_same(void **state)
{
    fixture *f = *state;
    table t;
    int count = 0;

    table_open(&t, "oracle/smarts.tsv");
    table_next(&t);
    while (table_next(&t)) {
        const bs_query *query = read_query(f, t.field[2]);
        const char *text = write_query(f, query);

        if (!same_query(query, read_query(f, text)))
            fail_msg("%s is written as %s", t.field[2], text);
        count++;
    }
    assert_int_equal(count, 123);
}

static void write__odd_graphs_read_as_the_same(void **state)
{
    static const char *const texts[] = {
        "C(C1)(C)C1",
        "C1.C1",
        "C(C(C)(C)C)(C(C)C)C",
        "(C.N).(O.F)",
        "(C=O).N.(O)",
        "C12CC1C2",
        "F/C=C\\F",
        "F/C=C/1CCCC1",
        "C/?C=C/C",
        "N[C@@H](C)C=O",
        "[C@]12(F)CC1C2",
        "C1CC1.C1CC1",
        "C-,=;@C",
        "C!-&!@C",
        "[C;$(C=O),$(C#N);!R]",
        "[C:1]-[O:2].[Na+:3]",
        "C=%10CCCC%10",
        "[Fe+2]~[#7]",
        "[13C@@H](F)Cl",
        "[$([C@H](F)Cl)]",
    };
    fixture *f = *state;

    for (size_t i = 0; i < sizeof texts / sizeof *texts; i++) {
        const bs_query *query = read_query(f, texts[i]);
        const char *text = write_query(f, query);
        const bs_query *again = read_query(f, text);

        if (query->atom_count != again->atom_count || query->bond_count != again->bond_count ||
            strcmp(write_query(f, again), text) != 0)
            fail_msg("%s is written as %s", texts[i], text);
        for (int k = 0; k < query->atom_count; k++)
            assert_int_equal(query->atoms[k].component, again->atoms[k].component);
    }
}

/* (C or (N and (R or +))): deeper than the operators of SMARTS reach. */
static void write__deep_logic_keeps_its_meaning(void **state)
{
    fixture *f = *state;
    bs_query *query;
    bs_query_expr c, n, r, plus, inner, both, whole;
    bs_ctx *cx = &f->cx;
    bs_arena *home = &f->home;

    check_ok(f, bs_query_new(cx, home, &query));
    check_ok(f, bs_query_leaf(cx, home, BS_TEST_ALIPHATIC_ELEM, 6, &c));
    check_ok(f, bs_query_leaf(cx, home, BS_TEST_ALIPHATIC_ELEM, 7, &n));
    check_ok(f, bs_query_leaf(cx, home, BS_TEST_RING_COUNT, -1, &r));
    check_ok(f, bs_query_leaf(cx, home, BS_TEST_CHARGE, 1, &plus));
    check_ok(f, bs_query_join(cx, home, BS_TEST_OR, &r, &plus, &inner));
    check_ok(f, bs_query_join(cx, home, BS_TEST_AND, &n, &inner, &both));
    check_ok(f, bs_query_join(cx, home, BS_TEST_OR, &c, &both, &whole));
    check_ok(f, bs_query_add_atom(cx, home, query, &(bs_query_atom){.expr = whole}, NULL));
    assert_string_equal(write_query(f, query), "[C,$([N;R,+])]");
    check_ok(f, bs_query_join(cx, home, BS_TEST_NOT, &inner, NULL, &query->atoms[0].expr));
    assert_string_equal(write_query(f, query), "[!$([R,+])]");
}

static void write__deep_bonds_keep_their_meaning(void **state)
{
    fixture *f = *state;
    bs_query *query = read_query(f, "C-,=;@C");
    bs_query_expr negated;
    uint32_t before, after;

    check_ok(f,
             bs_query_join(&f->cx, &f->home, BS_TEST_NOT, &query->bonds[0].expr, NULL, &negated));
    query->bonds[0].expr = negated;
    check_ok(f, bs_query_bond_mask(&f->cx, &negated, &before));
    query = read_query(f, write_query(f, query));
    check_ok(f, bs_query_bond_mask(&f->cx, &query->bonds[0].expr, &after));
    /* Orders 5 to 7 do not occur, and an aromatic bond has order 1 or 2. */
    for (int sort = 0; sort < 32; sort++)
        if ((sort & 7) <= 4 && (!(sort & 8) || (sort & 7) == 1 || (sort & 7) == 2))
            assert_int_equal(before >> sort & 1, after >> sort & 1);
}

/* ---- Putting together ------------------------------------------------------------------ */

static void append__numbers_move(void **state)
{
    fixture *f = *state;
    bs_query *query = read_query(f, "[$(C=O):1]N"), *more = read_query(f, "F[C@H](Cl)[$(CN)]");
    int first;

    check_ok(f, bs_query_append(&f->cx, &f->home, query, more, &first));
    assert_int_equal(first, 2);
    assert_int_equal(query->sub_count, 2);
    assert_string_equal(write_query(f, query), "[$(C=O):1]N.F[C&@&H1](Cl)[$(CN)]");
}

static void import__brings_recursive_parts_along(void **state)
{
    fixture *f = *state;
    bs_query *into = read_query(f, "[$(CF)]"), *from = read_query(f, "[$(CO);!$(CN)]");
    bs_query_expr expr;

    check_ok(f, bs_query_import(&f->cx, &f->home, into, from, &from->atoms[0].expr, &expr));
    check_ok(f, bs_query_join(&f->cx, &f->home, BS_TEST_AND, &into->atoms[0].expr, &expr,
                              &into->atoms[0].expr));
    assert_string_equal(write_query(f, into), "[$(CF)&$(CO)&!$(CN)]");
}

static void demands__only_what_and_joins(void **state)
{
    fixture *f = *state;
    const bs_query_expr *expr = &read_query(f, "[C;H2,H3;!D1;X4]")->atoms[0].expr;
    int value = 0;

    assert_true(bs_query_demands(expr, BS_TEST_CONNECTIONS, &value));
    assert_int_equal(value, 4);
    assert_true(bs_query_demands(expr, BS_TEST_ALIPHATIC_ELEM, &value));
    assert_int_equal(value, 6);
    assert_false(bs_query_demands(expr, BS_TEST_HYDROGENS, NULL));
    assert_false(bs_query_demands(expr, BS_TEST_DEGREE, NULL));
    assert_true(bs_query_mentions(expr, BS_TEST_DEGREE));
}

/* ---- Relaxing -------------------------------------------------------------------------- */

static void relax__drops_tests_under_either_sign(void **state)
{
    static const struct {
        const char *text;
        unsigned what;
        const char *becomes;
    } cases[] = {
        {"[C;H1;X4;+0]", BS_RELAX_EDITED, "[C&+0]"},
        {"[!H0]", BS_RELAX_EDITED, "*"},
        {"[C,H1]", BS_RELAX_EDITED, "*"},
        {"[!C;!H1]", BS_RELAX_EDITED, "[!C]"},
        {"[C;R;r6]", BS_RELAX_EDITED, "[C&R&r6]"},
        {"[C;R;r6]", BS_RELAX_RING, "C"},
        {"[!$(C=O);C]", BS_RELAX_EDITED, "[!$(C=O)&C]"},
        {"[!$(C=O);C]", BS_RELAX_RECURSION, "C"},
        {"[$([CH2]=O)]", BS_RELAX_EDITED, "[$([C&H2]=O)]"},
        {"[C@H](F)(Cl)Br", BS_RELAX_CHIRAL, "[C&H1](F)(Cl)Br"},
        {"F/C=C/F", BS_RELAX_CHIRAL, "F-C=C-F"},
        {"[c;+0]:[n]", BS_RELAX_AROMATIC, "[#6&+0]~[#7]"},
        {"C-,=;!@C", BS_RELAX_RING, "C-,=C"},
        {"[N;+,X3]", BS_RELAX_CHARGE, "N"},
    };
    fixture *f = *state;

    for (size_t i = 0; i < sizeof cases / sizeof *cases; i++) {
        bs_query *relaxed;

        check_ok(f, bs_query_relax(&f->cx, &f->home, read_query(f, cases[i].text), cases[i].what,
                                   &relaxed));
        assert_string_equal(write_query(f, relaxed), cases[i].becomes);
    }
}

/* not (C and (H1 or not +)): the sign reaches the tests through both operators. */
static void relax__pushes_not_down(void **state)
{
    fixture *f = *state;
    bs_query *query = read_query(f, "[C;H1,!+]"), *relaxed;

    check_ok(f, bs_query_join(&f->cx, &f->home, BS_TEST_NOT, &query->atoms[0].expr, NULL,
                              &query->atoms[0].expr));
    check_ok(f, bs_query_relax(&f->cx, &f->home, query, BS_RELAX_EDITED, &relaxed));
    assert_string_equal(write_query(f, relaxed), "[!C,+]");
}

/* ---- Memory ---------------------------------------------------------------------------- */

static void read__every_failed_allocation_is_rolled_back(void **state)
{
    static const char text[] = "[C@H]([$(C(=O)[O;H1,-])])(N)/C=C/c1c[nH]cn1";
    fixture *f = *state;
    bs_pattern *pattern;
    bs_status st = BS_ENOMEM;
    long n = 0;

    for (; st != BS_OK && n < 10000; n++) {
        atomic_store(&f->cx.gate->fail_after, n);
        st = bs_pattern_read(&f->cx, &f->home, text, sizeof text - 1, &pattern);
        if (st != BS_OK) {
            assert_int_equal(st, BS_ENOMEM);
            assert_int_equal(f->home.live, 0);
            assert_int_equal(f->cx.scratch.live, 0);
        }
    }
    atomic_store(&f->cx.gate->fail_after, -1);
    check_ok(f, st);
    check_requests(n, 11);
}

int main(void)
{
    const struct CMUnitTest tests[] = {
        check_case(read__hydrogen_is_an_atom_or_a_count),
        check_case(read__letter_pairs_and_defaults),
        check_case(read__logic_binds_not_and_or_and),
        check_case(read__errors_tell_place_and_want),
        check_case(read__nul_is_no_end),
        check_case(read__depth_and_size_are_bounded),
        check_case(read__neighbours_of_a_centre_stand_in_order),
        check_case(write__oracle_patterns_read_as_the_same),
        check_case(write__odd_graphs_read_as_the_same),
        check_case(write__deep_logic_keeps_its_meaning),
        check_case(write__deep_bonds_keep_their_meaning),
        check_case(append__numbers_move),
        check_case(import__brings_recursive_parts_along),
        check_case(demands__only_what_and_joins),
        check_case(relax__drops_tests_under_either_sign),
        check_case(relax__pushes_not_down),
        check_case(read__every_failed_allocation_is_rolled_back),
    };

    return cmocka_run_group_tests_name("match.query", tests, NULL, NULL);
}
