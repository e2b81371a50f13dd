/*
 * All rows of the coverage table as plain rewritings and as transforms.
 *
 * tests/data/coverage/transforms.tsv.gz has the columns id, kind, target_motif, precursors,
 * example_product, example_precursors, counterexample_product, why_not, pack of a table of 771
 * transforms written from knowledge of the field and checked with RDKit 2022.09.3. Rows that we
 * answer differently are listed below, each with its reason.
 */
#include <stdio.h>

#include "rule/case.h"
#include "support/table.h"

typedef struct row {
    const char *id, *target, *from, *product, *precursors, *refused, *why;
} row;

typedef struct exception {
    const char *id, *why;
} exception;

/* Rows whose precursors do not come out, or whose step does not stand the check. */
static const exception exceptions[] = {
    {"dehydroamino-acid-hydrogenation",
     "the template writes no geometry for the new double bond, the example's precursor has it"},
};

static bool is_listed(const char *id)
{
    for (size_t i = 0; i < sizeof exceptions / sizeof *exceptions; i++) {
        if (strcmp(exceptions[i].id, id) == 0)
            return true;
    }
    return false;
}

static bool next_row(table *t, row *out)
{
    if (!table_next(t))
        return false;
    assert_int_equal(t->field_count, 9);
    *out = (row){t->field[0], t->field[2], t->field[3], t->field[4], t->field[5],
                 t->field[6], t->field[7]};
    return true;
}

static bool rewriting_gives(fixture *f, const row *r)
{
    char smarts[8192];
    bs_rewrite *rewrite = NULL;
    const bs_mol *product = read_mol(f, r->product);
    char *wanted = canonical_pieces(f, r->precursors);
    bs_outcomes out = {0};
    bool found = false;

    snprintf(smarts, sizeof smarts, "%s>>%s", r->target, r->from);
    if (bs_rewrite_read(&f->cx, &f->home, smarts, strlen(smarts), &rewrite) != BS_OK) {
        print_error("%s: %s at %ld\n", r->id, f->cx.error.message, f->cx.error.offset);
        return false;
    }
    check_ok(f, bs_rewrite_apply(&f->cx, &f->home, rewrite, &product, 1, &out));
    for (int i = 0; i < out.count && !found; i++)
        found = strcmp(outcome_text(f, &out.items[i]), wanted) == 0;
    if (!found && !is_listed(r->id)) {
        print_error("%s: %s >> %s: wanted %s\n", r->id, r->target, r->from, wanted);
        for (int i = 0; i < out.count; i++)
            print_error("  got %s\n", outcome_text(f, &out.items[i]));
    }
    return found;
}

static void coverage__every_example_comes_out_backwards(void **state)
{
    fixture *f = *state;
    static table t;
    row r;
    int rows = 0, good = 0, listed = 0;

    table_open(&t, "coverage/transforms.tsv.gz");
    assert_true(table_next(&t));
    while (next_row(&t, &r)) {
        bs_mark mark = bs_arena_mark(&f->home);

        rows++;
        if (rewriting_gives(f, &r))
            good++;
        else
            listed += is_listed(r.id);
        bs_arena_rewind(&f->home, mark);
    }
    print_message("%d of %d rows give their precursors\n", good, rows);
    assert_int_equal(rows, 771);
    assert_int_equal(good + listed, rows);
    assert_true(good * 100 >= rows * 97);
}

/* The precursors of a step, piece by piece, each as often as it is used. */
static char *step_text(fixture *f, const bs_step *step)
{
    char **texts = NULL;
    int count = 0;

    check_ok(f, bs_new(&f->cx, &f->home, 64, &texts));
    for (int i = 0; i < step->precursor_count; i++) {
        bs_mol **pieces = NULL;
        int parts = 0;

        check_ok(f, bs_mol_fragments(&f->cx, &f->home, step->precursors[i], &pieces, &parts));
        for (int n = 0; n < (int)(step->equivalents[i] + 0.5); n++) {
            for (int k = 0; k < parts && count < 64; k++)
                check_ok(f, bs_smiles_canonical(&f->cx, &f->home, pieces[k], 0, &texts[count++]));
        }
    }
    return join_smiles(f, texts, count);
}

static bool transform_gives(fixture *f, const bs_rules *rules, int index, const row *r, int *open)
{
    const bs_mol *product = read_mol(f, r->product);
    char *wanted = canonical_pieces(f, r->precursors);
    bs_steps steps = {0};

    check_ok(f, bs_rules_back(&f->cx, &f->home, rules, index, product, NULL, 0, &steps));
    for (int i = 0; i < steps.count; i++) {
        if (strcmp(step_text(f, &steps.items[i]), wanted) == 0) {
            *open += steps.items[i].stereo_open;
            return true;
        }
    }
    if (!is_listed(r->id)) {
        print_error("%s: %s: no checked step to %s\n", r->id, r->product, wanted);
        for (int i = 0; i < steps.count; i++)
            print_error("  got %s\n", step_text(f, &steps.items[i]));
    }
    return false;
}

static void coverage__every_example_stands_the_forward_check(void **state)
{
    fixture *f = *state;
    static table t;
    bs_rules *rules = NULL;
    row r;
    int rows = 0, good = 0, listed = 0, open = 0;

    check_ok(f, bs_rules_new(&f->cx, &rules));
    table_open(&t, "coverage/transforms.tsv.gz");
    assert_true(table_next(&t));
    while (next_row(&t, &r)) {
        bs_mark mark = bs_arena_mark(&f->home);
        bs_transform_def def = {.name = r.id, .target = r.target, .from = r.from,
                                .hook_when = -1, .hook_prefer = -1};
        int index = -1;

        rows++;
        if (bs_rules_add_transform(&f->cx, rules, &def, &index) != BS_OK)
            print_error("%s: %s\n", r.id, f->cx.error.message);
        else if (transform_gives(f, rules, index, &r, &open))
            good++;
        else
            listed += is_listed(r.id);
        bs_arena_rewind(&f->home, mark);
    }
    bs_rules_free(rules);
    print_message("%d of %d rows stand the forward check, %d with stereo left open\n", good, rows,
                  open);
    assert_int_equal(good + listed, rows);
    assert_true(good * 100 >= rows * 97);
}

/* A row's counterexample; those that only a condition in code refuses say "when:". */
static bool is_refused(fixture *f, const bs_rules *rules, int index, const row *r)
{
    const bs_mol *product = read_mol(f, r->refused);
    bs_steps steps = {0};

    check_ok(f, bs_rules_back(&f->cx, &f->home, rules, index, product, NULL, 0, &steps));
    if (steps.count == 0 || strncmp(r->why, "when:", 5) == 0)
        return true;
    print_error("%s: %s is not refused (%s): %s\n", r->id, r->refused, r->why,
                step_text(f, &steps.items[0]));
    return false;
}

static void coverage__every_counterexample_is_refused(void **state)
{
    fixture *f = *state;
    static table t;
    bs_rules *rules = NULL;
    row r;
    int bad = 0;

    check_ok(f, bs_rules_new(&f->cx, &rules));
    table_open(&t, "coverage/transforms.tsv.gz");
    assert_true(table_next(&t));
    while (next_row(&t, &r)) {
        bs_mark mark = bs_arena_mark(&f->home);
        bs_transform_def def = {.name = r.id, .target = r.target, .from = r.from,
                                .hook_when = -1, .hook_prefer = -1};
        int index = -1;

        check_ok(f, bs_rules_add_transform(&f->cx, rules, &def, &index));
        bad += !is_refused(f, rules, index, &r);
        bs_arena_rewind(&f->home, mark);
    }
    bs_rules_free(rules);
    assert_int_equal(bad, 0);
}

int main(void)
{
    const struct CMUnitTest tests[] = {
        check_case(coverage__every_example_comes_out_backwards),
        check_case(coverage__every_example_stands_the_forward_check),
        check_case(coverage__every_counterexample_is_refused),
    };

    return cmocka_run_group_tests(tests, NULL, NULL);
}
