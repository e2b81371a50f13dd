/*
 * Reaction SMARTS against reference answers: tests/data/oracle/reactions.jsonl has the products
 * that RDKit gives, as described in the README beside it. We agree on all that count.
 */
#include <stdio.h>

#include <jansson.h>

#include "rule/case.h"

static bs_outcomes run(fixture *f, const char *smarts, const char **reactants, int count)
{
    bs_rewrite *rewrite = NULL;
    const bs_mol *mols[4];
    bs_outcomes out = {0};

    if (bs_rewrite_read(&f->cx, &f->home, smarts, strlen(smarts), &rewrite) != BS_OK)
        fail_msg("%s: %s", smarts, f->cx.error.message);
    for (int i = 0; i < count; i++)
        mols[i] = read_mol(f, reactants[i]);
    check_ok(f, bs_rewrite_apply(&f->cx, &f->home, rewrite, mols, count, &out));
    return out;
}

static bool has_set(fixture *f, const bs_outcomes *out, const char *wanted)
{
    for (int i = 0; i < out->count; i++) {
        if (strcmp(outcome_text(f, &out->items[i]), wanted) == 0)
            return true;
    }
    return false;
}

/* The canonical text of one product set of the file. */
static char *set_text(fixture *f, json_t *set)
{
    char **texts = NULL;
    size_t count = json_array_size(set);

    check_ok(f, bs_new(&f->cx, &f->home, count + 1, &texts));
    for (size_t i = 0; i < count; i++)
        texts[i] = canonical(f, json_string_value(json_array_get(set, i)));
    return join_smiles(f, texts, (int)count);
}

static int check_one(fixture *f, const char *id, const char *smarts, int number, json_t *one)
{
    json_t *sets = json_object_get(one, "products"), *given = json_object_get(one, "reactants");
    const char *reactants[4];
    bs_outcomes out;
    int bad = 0;

    for (size_t i = 0; i < json_array_size(given) && i < 4; i++)
        reactants[i] = json_string_value(json_array_get(given, i));
    out = run(f, smarts, reactants, (int)json_array_size(given));
    if (out.count != (int)json_array_size(sets)) {
        print_error("%s case %d: %d sets, expected %d\n", id, number, out.count,
                    (int)json_array_size(sets));
        bad = 1;
    }
    for (size_t i = 0; i < json_array_size(sets); i++) {
        char *wanted = set_text(f, json_array_get(sets, i));

        if (!has_set(f, &out, wanted)) {
            print_error("%s case %d: %s is missing\n", id, number, wanted);
            bad = 1;
        }
    }
    for (int i = 0; i < out.count && bad; i++)
        print_error("  got %s\n", outcome_text(f, &out.items[i]));
    return bad;
}

static int check_reaction(fixture *f, json_t *reaction, int *checked)
{
    const char *id = json_string_value(json_object_get(reaction, "id"));
    const char *smarts = json_string_value(json_object_get(reaction, "smarts"));
    json_t *cases = json_object_get(reaction, "cases");
    int bad = 0;

    for (size_t i = 0; i < json_array_size(cases); i++) {
        json_t *one = json_array_get(cases, i);

        if (!json_is_true(json_object_get(one, "counts")))
            continue;
        (*checked)++;
        bad += check_one(f, id, smarts, (int)i, one);
    }
    return bad;
}

static void rewrite__agrees_with_the_reference(void **state)
{
    fixture *f = *state;
    FILE *file = fopen(BACKSAW_TEST_DATA "/oracle/reactions.jsonl", "r");
    char line[8192];
    int bad = 0, checked = 0;

    assert_non_null(file);
    while (fgets(line, sizeof line, file)) {
        json_t *reaction = json_loads(line, 0, NULL);

        assert_non_null(reaction);
        bad += check_reaction(f, reaction, &checked);
        json_decref(reaction);
    }
    fclose(file);
    assert_int_equal(checked, 84);
    assert_int_equal(bad, 0);
}

/*
 * The two cases of r34 with "counts": false: the carbinol hydrogen goes whether or not the centre
 * was marked.
 */
static void rewrite__arguable_cases_come_out_as_a_chemist_expects(void **state)
{
    fixture *f = *state;
    const char *smarts = "[CX4;H1:1][OX2H1:2]>>[C:1]=[O:2]";
    const char *alcohols[] = {"", "C[C@H](O)CC", "C[C@H](O)[C@H](C)CC"};
    const char *ketones[] = {"", "CCC(C)=O", "CC(=O)[C@H](C)CC"};

    for (int i = 1; i < 3; i++) {
        bs_outcomes out = run(f, smarts, &alcohols[i], 1);

        assert_int_equal(out.count, 1);
        assert_string_equal(outcome_text(f, &out.items[0]), canonical(f, ketones[i]));
    }
}

/* Common practice, no source: a ring bond cut into two templates gives no molecules. */
static void rewrite__ring_cut_needs_a_group(void **state)
{
    fixture *f = *state;
    const char *lactone = "O=C1CCCCO1";
    bs_outcomes out = run(f, "[C:1]@[O:2]>>[C:1]O.[O:2]", &lactone, 1);

    assert_int_equal(out.count, 0);
    out = run(f, "[C:1](=O)@[O:2]>>([C:1](=O)O.[O:2])", &lactone, 1);
    assert_true(out.count >= 1);
}

static void rewrite__geometry_on_the_left_is_asked(void **state)
{
    fixture *f = *state;
    const char *smarts = "[C:1]/[C:2]=[C:3]\\[C:4]>>[C:1][C:2]#[C:3][C:4]";
    const char *z = "CC/C=C\\CC", *e = "CC/C=C/CC", *unmarked = "CCC=CCC";

    assert_int_equal(run(f, smarts, &z, 1).count, 1);
    assert_int_equal(run(f, smarts, &e, 1).count, 0);
    assert_int_equal(run(f, smarts, &unmarked, 1).count, 0);
}

/* SN2 with inversion keeps the other centres; the neighbour exchanged stands in place. */
static void rewrite__unmarked_exchange_keeps_the_hand(void **state)
{
    fixture *f = *state;
    const char *bromide = "C[C@H](Br)CC";
    bs_outcomes out = run(f, "[C:1]Br>>[C:1]O", &bromide, 1);

    assert_int_equal(out.count, 1);
    assert_string_equal(outcome_text(f, &out.items[0]), canonical(f, "C[C@H](O)CC"));
}

static void rewrite__double_bond_keeps_geometry_when_its_halogen_is_exchanged(void **state)
{
    fixture *f = *state;
    const char *bromide = "C/C=C/Br";
    bs_outcomes out = run(f, "[C:1]Br>>[C:1]C#N", &bromide, 1);

    assert_int_equal(out.count, 1);
    assert_string_equal(outcome_text(f, &out.items[0]), canonical(f, "C/C=C/C#N"));
}

/* Textbook: hydrogenation of naphthalene's one ring leaves the other aromatic, in any Kekulé form. */
static void rewrite__aromatic_rest_finds_its_double_bonds(void **state)
{
    fixture *f = *state;
    const char *naphthalene = "c1ccc2ccccc2c1";
    bs_outcomes out = run(f, "[cH:1]1[cH:2][cH:3][cH:4][c:5][c:6]1>>[C:1]1[C:2][C:3][C:4][c:5]:[c:6]1",
                          &naphthalene, 1);

    assert_int_equal(out.count, 1);
    assert_string_equal(outcome_text(f, &out.items[0]), canonical(f, "C1CCc2ccccc2C1"));
}

/* Paal-Knorr with ammonia: the rule writes n, and the nitrogen needs its hydrogen. */
static void rewrite__new_pyrrole_nitrogen_gets_its_hydrogen(void **state)
{
    fixture *f = *state;
    const char *reactants[] = {"CC(=O)CCC(C)=O", "N"};
    bs_outcomes out = run(f, "[CX3:1](=O)[CX4:2][CX4:3][CX3:4](=O).[NX3:5]>>"
                             "[c:1]1[c:2][c:3][c:4][n:5]1",
                          reactants, 2);

    assert_int_equal(out.count, 1);
    assert_string_equal(outcome_text(f, &out.items[0]), canonical(f, "Cc1ccc(C)[nH]1"));
}

/* Azinones and chloroazines (POCl3; common practice, no source): the ring stays aromatic both ways. */
static void rewrite__ring_keeps_aromatic_when_an_oxo_group_goes(void **state)
{
    fixture *f = *state;
    const char *azinone = "O=c1[nH]cnc2ccccc12", *chloride = "Clc1ncnc2ccccc12";
    bs_outcomes out = run(f, "[c:1](=O):[nH:2]>>[c:1](-Cl):[nH0:2]", &azinone, 1);

    assert_int_equal(out.count, 1);
    assert_string_equal(outcome_text(f, &out.items[0]), canonical(f, chloride));
    out = run(f, "[c:1](-Cl):[n:2]>>[c:1](=O):[nH:2]", &chloride, 1);
    assert_int_equal(out.count, 1);
    assert_string_equal(outcome_text(f, &out.items[0]), canonical(f, azinone));
}

static void rewrite__site_tells_where_the_left_side_lay(void **state)
{
    fixture *f = *state;
    const char *reactants[] = {"CC(=O)Cl", "NCC"};
    bs_outcomes out = run(f, "[C:1](=[O:2])Cl.[NX3:3]>>[C:1](=[O:2])[N:3]", reactants, 2);

    assert_int_equal(out.count, 1);
    assert_int_equal(out.items[0].site_count, 4);
    assert_int_equal(out.items[0].site_reactant[0], 0);
    assert_int_equal(out.items[0].site_atom[0], 1);
    assert_int_equal(out.items[0].site_reactant[3], 1);
    assert_int_equal(out.items[0].site_atom[3], 0);
}

static void check_error(fixture *f, const char *smarts, bs_status wanted, long offset)
{
    bs_rewrite *rewrite;
    size_t live = f->home.live;

    assert_int_equal(bs_rewrite_read(&f->cx, &f->home, smarts, strlen(smarts), &rewrite), wanted);
    assert_int_equal(f->cx.error.offset, offset);
    assert_int_equal(f->home.live, live);
}

static void rewrite__errors_tell_the_place(void **state)
{
    fixture *f = *state;

    check_error(f, "[C:1]", BS_ESYNTAX, 5);
    check_error(f, "[C:1]>>[C:1", BS_ESYNTAX, 7);
    check_error(f, "[C:1][C:1]>>[C:1]", BS_EVALUE, 5);
    check_error(f, "[C:1]>>[C:1][*]", BS_EVALUE, 12);
}

static void rewrite__wrong_number_of_reactants_is_refused(void **state)
{
    fixture *f = *state;
    const char *smarts = "[C:1].[O:2]>>[C:1][O:2]";
    bs_rewrite *rewrite = NULL;
    const bs_mol *mol = read_mol(f, "C");
    bs_outcomes out;

    check_ok(f, bs_rewrite_read(&f->cx, &f->home, smarts, strlen(smarts), &rewrite));
    assert_int_equal(bs_rewrite_reactant_count(rewrite), 2);
    assert_int_equal(bs_rewrite_apply(&f->cx, &f->home, rewrite, &mol, 1, &out), BS_EVALUE);
}

static void rewrite__too_many_places_are_a_limit(void **state)
{
    fixture *f = *state;
    const char *smarts = "[C:1].[C:2]>>[C:1][C:2]";
    bs_rewrite *rewrite = NULL;
    char chain[202] = {0};
    const bs_mol *mols[2];
    bs_outcomes out;

    memset(chain, 'C', 200);
    mols[0] = mols[1] = read_mol(f, chain);
    check_ok(f, bs_rewrite_read(&f->cx, &f->home, smarts, strlen(smarts), &rewrite));
    assert_int_equal(bs_rewrite_apply(&f->cx, &f->home, rewrite, mols, 2, &out), BS_ELIMIT);
}

static void rewrite__every_failed_allocation_is_rolled_back(void **state)
{
    fixture *f = *state;
    const char *smarts = "[C:1](=[O:2])Cl.[NX3:3]>>[C:1](=[O:2])[N:3]";
    const bs_mol *mols[] = {read_mol(f, "CC(=O)Cl"), read_mol(f, "NCC")};
    size_t live = f->home.live;
    bs_status st = BS_ENOMEM;

    for (long n = 0; n < 5000 && st == BS_ENOMEM; n++) {
        bs_rewrite *rewrite;
        bs_outcomes out;

        atomic_store(&f->cx.own_gate.fail_after, n);
        st = bs_rewrite_read(&f->cx, &f->home, smarts, strlen(smarts), &rewrite);
        if (st == BS_OK) {
            size_t compiled = f->home.live;

            st = bs_rewrite_apply(&f->cx, &f->home, rewrite, mols, 2, &out);
            if (st != BS_OK)
                assert_int_equal(f->home.live, compiled);
        } else {
            assert_int_equal(f->home.live, live);
        }
        atomic_store(&f->cx.own_gate.fail_after, -1);
        assert_int_equal(f->cx.scratch.live, 0);
    }
    assert_int_equal(st, BS_OK);
}

int main(void)
{
    const struct CMUnitTest tests[] = {
        check_case(rewrite__agrees_with_the_reference),
        check_case(rewrite__arguable_cases_come_out_as_a_chemist_expects),
        check_case(rewrite__ring_cut_needs_a_group),
        check_case(rewrite__geometry_on_the_left_is_asked),
        check_case(rewrite__unmarked_exchange_keeps_the_hand),
        check_case(rewrite__double_bond_keeps_geometry_when_its_halogen_is_exchanged),
        check_case(rewrite__aromatic_rest_finds_its_double_bonds),
        check_case(rewrite__new_pyrrole_nitrogen_gets_its_hydrogen),
        check_case(rewrite__ring_keeps_aromatic_when_an_oxo_group_goes),
        check_case(rewrite__site_tells_where_the_left_side_lay),
        check_case(rewrite__errors_tell_the_place),
        check_case(rewrite__wrong_number_of_reactants_is_refused),
        check_case(rewrite__too_many_places_are_a_limit),
        check_case(rewrite__every_failed_allocation_is_rolled_back),
    };

    return cmocka_run_group_tests(tests, NULL, NULL);
}
