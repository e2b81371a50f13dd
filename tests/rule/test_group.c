/*
 * Groups in a rule book: inheritance of fates, redefinition, taking back, and want of memory. What
 * is expected follows from the definitions in group.h; the chemistry is tested with the standard
 * packs (tests/stdlib/compatibility.lua).
 */
#include "rule/case.h"

#include <stdlib.h>
#include <string.h>

#include "backsaw/group.h"

#define WORDS(...)                                                                                 \
    (bs_words)                                                                                     \
    {                                                                                              \
        (const char *const[]){__VA_ARGS__},                                                        \
            sizeof((const char *const[]){__VA_ARGS__}) / sizeof(const char *)                      \
    }

static bs_status add_group(bs_ctx *cx, bs_rules *rules, const char *name, const char *smarts,
                           bs_words parents)
{
    bs_group_def def = {.name = name, .smarts = smarts, .parents = parents};

    return bs_rules_add_group(cx, rules, &def);
}

static bs_status add_class(bs_ctx *cx, bs_rules *rules, const char *name, bs_words attacked,
                           bs_words slow)
{
    bs_fate_def fates[] = {{attacked, BS_ATTACKED, "breaks"}, {slow, BS_SLOW, "bends"}};
    bs_conditions_def def = {.name = name, .fates = fates, .fate_count = 2};

    return bs_rules_add_conditions(cx, rules, &def);
}

/* Carbonyl, its children aldehyde and ketone, an ether, and an oddity with two parents. */
static bs_status fill(bs_ctx *cx, bs_rules *rules)
{
    bs_words none = {NULL, 0};
    bs_status st;

    if ((st = add_group(cx, rules, "carbonyl", "[CX3]=O", none)) != BS_OK ||
        (st = add_group(cx, rules, "aldehyde", "[CX3;H1]=O", WORDS("carbonyl"))) != BS_OK ||
        (st = add_group(cx, rules, "ether", "[OX2]([#6])[#6]", none)) != BS_OK ||
        (st = add_group(cx, rules, "ester", "[CX3](=O)[OX2][#6]", WORDS("Carbonyl", "ether"))) !=
            BS_OK)
        return st;
    return add_class(cx, rules, "hammer", WORDS("ether"), WORDS("carbonyl"));
}

static bs_fate fate(fixture *f, const bs_rules *rules, const char *group)
{
    bs_fate found;

    check_ok(f, bs_rules_fate(&f->cx, rules, bs_rules_find_group(rules, group),
                              bs_rules_find_conditions(rules, "hammer"), &found, NULL));
    return found;
}

static void fates__are_the_worst_of_the_parents(void **state)
{
    fixture *f = *state;
    bs_fate_def own = {WORDS("ester"), BS_SURVIVES, NULL};
    bs_rules *rules;

    check_ok(f, bs_rules_new(&f->cx, &rules));
    check_ok(f, fill(&f->cx, rules));
    assert_int_equal(fate(f, rules, "carbonyl"), BS_SLOW);
    assert_int_equal(fate(f, rules, "aldehyde"), BS_SLOW);
    assert_int_equal(fate(f, rules, "ester"), BS_ATTACKED);
    check_ok(f, bs_rules_add_fate(&f->cx, rules, "Hammer", &own));
    assert_int_equal(fate(f, rules, "ester"), BS_SURVIVES);
    assert_int_equal(fate(f, rules, "ether"), BS_ATTACKED);
    bs_rules_free(rules);
}

static void hits__are_hidden_by_narrower_ones(void **state)
{
    fixture *f = *state;
    bs_rules *rules;
    bs_mol *mol = read_mol(f, "CCOC(C)=O");
    bs_group_hits hits;

    check_ok(f, bs_rules_new(&f->cx, &rules));
    check_ok(f, fill(&f->cx, rules));
    check_ok(f, bs_groups_find(&f->cx, &f->home, rules, mol, &hits));
    /* The ester covers both its carbonyl and its ether oxygen with neighbours. */
    assert_int_equal(hits.count, 1);
    assert_string_equal(bs_rules_group(rules, hits.items[0].group)->name, "ester");
    check_ok(f, bs_group_hits_of(&f->cx, &f->home, rules, 0, mol, &hits));
    assert_int_equal(hits.count, 1);
    bs_rules_free(rules);
}

static void book__forgets_what_came_after_a_mark(void **state)
{
    fixture *f = *state;
    bs_words none = {NULL, 0};
    bs_fate_def later = {WORDS("carbonyl", "late"), BS_ATTACKED, NULL};
    bs_rules *rules;
    bs_rules_mark mark;

    check_ok(f, bs_rules_new(&f->cx, &rules));
    check_ok(f, fill(&f->cx, rules));
    mark = bs_rules_grown(rules);
    check_ok(f, add_group(&f->cx, rules, "late", "[NX3]", none));
    check_ok(f, bs_rules_add_fate(&f->cx, rules, "hammer", &later));
    assert_int_equal(fate(f, rules, "carbonyl"), BS_ATTACKED);
    bs_rules_rewind(rules, mark);
    assert_int_equal(bs_rules_find_group(rules, "late"), -1);
    assert_int_equal(bs_rules_group_count(rules), 4);
    assert_int_equal(fate(f, rules, "carbonyl"), BS_SLOW);
    check_ok(f, add_group(&f->cx, rules, "late", "[SX2]", none));
    assert_int_equal(fate(f, rules, "late"), BS_SURVIVES);
    bs_rules_free(rules);
}

static void group__defined_anew_cannot_become_its_own_child(void **state)
{
    fixture *f = *state;
    bs_rules *rules;

    check_ok(f, bs_rules_new(&f->cx, &rules));
    check_ok(f, fill(&f->cx, rules));
    assert_int_equal(add_group(&f->cx, rules, "carbonyl", "C=O", WORDS("ester")), BS_EVALUE);
    assert_int_equal(add_group(&f->cx, rules, "carbonyl", "C=O", WORDS("carbonyl")), BS_EVALUE);
    assert_int_equal(bs_rules_group_count(rules), 4);
    /* The ester loses one parent, and with it the worse fate. */
    check_ok(f, add_group(&f->cx, rules, "ester", "[CX3](=O)[OX2][#6]", WORDS("carbonyl")));
    assert_int_equal(bs_rules_group_count(rules), 4);
    assert_int_equal(fate(f, rules, "ester"), BS_SLOW);
    bs_rules_free(rules);
}

/* Every request in turn fails; nothing leaks, and a second try on the same book succeeds or says
   what is there already. */
static void definitions__survive_want_of_memory(void **state)
{
    fixture *f = *state;
    int failed = 0;

    for (long k = 0;; k++) {
        bs_rules *rules;
        bs_status st;

        check_ok(f, bs_rules_new(&f->cx, &rules));
        atomic_store(&f->cx.gate->fail_after, k);
        st = fill(&f->cx, rules);
        atomic_store(&f->cx.gate->fail_after, -1);
        bs_rules_free(rules);
        if (st == BS_OK)
            break;
        assert_int_equal(st, BS_ENOMEM);
        failed++;
    }
    check_requests(failed, 20);
}

static void clashes__survive_want_of_memory(void **state)
{
    fixture *f = *state;
    bs_mol *mol = read_mol(f, "CCOC(C)=O");
    bs_rules *rules;
    int failed = 0;

    check_ok(f, bs_rules_new(&f->cx, &rules));
    check_ok(f, fill(&f->cx, rules));
    for (long k = 0;; k++) {
        bs_clashes found;
        bs_status st;

        atomic_store(&f->cx.gate->fail_after, k);
        st = bs_clashes_find(&f->cx, &f->home, rules, mol, 0, NULL, &found);
        atomic_store(&f->cx.gate->fail_after, -1);
        if (st == BS_OK) {
            assert_true(found.count > 0);
            assert_int_equal(found.items[0].fate, BS_ATTACKED);
            break;
        }
        assert_int_equal(st, BS_ENOMEM);
        failed++;
    }
    check_requests(failed, 5);
    bs_rules_free(rules);
}

int main(void)
{
    const struct CMUnitTest tests[] = {
        check_case(fates__are_the_worst_of_the_parents),
        check_case(hits__are_hidden_by_narrower_ones),
        check_case(book__forgets_what_came_after_a_mark),
        check_case(group__defined_anew_cannot_become_its_own_child),
        check_case(definitions__survive_want_of_memory),
        check_case(clashes__survive_want_of_memory),
    };

    return cmocka_run_group_tests_name("group", tests, NULL, NULL);
}
