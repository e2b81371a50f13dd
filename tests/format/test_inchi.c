/* InChI and InChIKey against reference values. */
#include <pthread.h>

#include "support/check.h"
#include "support/table.h"

#include "backsaw/format.h"

static bs_mol *parse(fixture *f, const char *smiles)
{
    bs_mol *mol = NULL;

    check_ok(f, bs_smiles_read(&f->cx, &f->home, smiles, strlen(smiles), NULL, &mol));
    return mol;
}

static char *inchi(fixture *f, const char *smiles, bool key)
{
    char *text = NULL;

    check_ok(f, bs_inchi(&f->cx, &f->home, parse(f, smiles), key, &text));
    return text;
}

/* Where the layers of two InChIs begin to differ: the letter of the layer. */
static char first_difference(const char *a, const char *b)
{
    char layer = '0';

    for (; *a && *a == *b; a++, b++)
        if (*a == '/')
            layer = a[1];
    return layer;
}

/* Molecules and keys: the oracle set; see tests/data/oracle/README.md. */
static void inchikey__agrees_with_the_reference(void **state)
{
    fixture *f = *state;
    bs_mark mark = bs_arena_mark(&f->home);
    int wrong = 0, lines = 0;
    table *molecules, *expected;

    check_ok(f, bs_new(&f->cx, &f->home, 1, &molecules));
    check_ok(f, bs_new(&f->cx, &f->home, 1, &expected));
    mark = bs_arena_mark(&f->home);
    table_open(molecules, "oracle/molecules.smi.gz");
    table_open(expected, "oracle/molecules-expected.tsv.gz");
    assert_true(table_next(expected));
    while (table_next(molecules)) {
        const char *smiles = molecules->field[0];

        assert_true(table_next(expected));
        assert_string_equal(molecules->field[1], expected->field[0]);
        lines++;
        if (strcmp(inchi(f, smiles, true), expected->field[1]) != 0) {
            const char *mine = inchi(f, smiles, false);

            wrong++;
            print_message("%s %s differs in layer %c: %s for %s\n", expected->field[0], smiles,
                          first_difference(mine, expected->field[2]), mine, expected->field[2]);
        }
        bs_arena_rewind(&f->home, mark);
    }
    assert_false(table_next(expected));
    assert_int_equal(lines, 5000);
    /* The reference reads the cumulene own-41 without its geometry; ours are to be kept. */
    assert_in_range(wrong, 0, 1);
}

/* Values as published by the InChI Trust and in common databases. */
static void inchi__known_molecules(void **state)
{
    fixture *f = *state;

    assert_string_equal(inchi(f, "CCO", false), "InChI=1S/C2H6O/c1-2-3/h3H,2H2,1H3");
    assert_string_equal(inchi(f, "CCO", true), "LFQSCWFLJHTTHZ-UHFFFAOYSA-N");
    assert_string_equal(inchi(f, "N[C@@H](C)C(=O)O", true), "QNAYBMKLOCPYGJ-REOHCLBHSA-N");
    assert_string_equal(inchi(f, "C/C=C/C", false), "InChI=1S/C4H8/c1-3-4-2/h3-4H,1-2H3/b4-3+");
}

static void inchi__allenes_keep_their_hand(void **state)
{
    fixture *f = *state;
    char *one = inchi(f, "CC=[C@]=CC", false), *other = inchi(f, "CC=[C@@]=CC", false);

    assert_string_not_equal(one, other);
    /* An exchange of hydrogen and methyl on one end turns the hand. */
    assert_string_equal(one, inchi(f, "C(C)([H])=[C@]=CC", false));
    assert_string_equal(other, inchi(f, "C([H])(C)=[C@]=CC", false));
    /*
     * What the library itself makes of coordinates: seen from the front, methyl at the left of the
     * front end, the other methyl at the top of the rear end, hydrogens opposite. From the first
     * methyl, its hydrogen, the other hydrogen and the other methyl run clockwise: `@@`.
     */
    assert_string_equal(other, "InChI=1S/C5H8/c1-3-5-4-2/h3-4H,1-2H3/t5-/m1/s1");
}

static void inchi__cumulenes_keep_their_geometry(void **state)
{
    fixture *f = *state;

    assert_string_not_equal(inchi(f, "C/C=C=C=C/C", false), inchi(f, "C/C=C=C=C\\C", false));
    assert_string_equal(inchi(f, "C/C=C=C=C/C", false), inchi(f, "C\\C=C=C=C\\C", false));
    assert_string_equal(inchi(f, "C/C=C=C=C/C", false), inchi(f, "C(\\C)=C=C=C/C", false));
}

static void inchi__no_memory_is_reported(void **state)
{
    fixture *f = *state;
    bs_mol *mol = parse(f, "C[C@H](N)C(=O)O");
    bs_status st = BS_ENOMEM;
    char *text;

    for (long n = 0; st != BS_OK; n++) {
        atomic_store(&f->cx.own_gate.fail_after, n);
        st = bs_inchi(&f->cx, &f->home, mol, true, &text);
        atomic_store(&f->cx.own_gate.fail_after, -1);
        assert_true(st == BS_OK || st == BS_ENOMEM);
        assert_int_equal(f->cx.scratch.live, 0);
    }
    /* The lock was given back each time. */
    assert_string_equal(text, "QNAYBMKLOCPYGJ-REOHCLBHSA-N");
}

/* One thread's work: the key of one molecule, many times; counts the wrong ones. */
static void *make_keys(void *wrong)
{
    fixture own;

    bs_ctx_init(&own.cx, NULL);
    bs_arena_init(&own.home, own.cx.gate);
    for (int i = 0; i < 100; i++) {
        bs_mark mark = bs_arena_mark(&own.home);
        bs_mol *mol;
        char *text;

        if (bs_smiles_read(&own.cx, &own.home, "CCO", 3, NULL, &mol) != BS_OK ||
            bs_inchi(&own.cx, &own.home, mol, true, &text) != BS_OK ||
            strcmp(text, "LFQSCWFLJHTTHZ-UHFFFAOYSA-N") != 0)
            ++*(int *)wrong;
        bs_arena_rewind(&own.home, mark);
    }
    bs_arena_free(&own.home);
    bs_ctx_free(&own.cx);
    return NULL;
}

static void inchi__threads_wait_for_each_other(void **state)
{
    pthread_t thread[4];
    int wrong[4] = {0};

    (void)state;
    for (int i = 0; i < 4; i++)
        assert_int_equal(pthread_create(&thread[i], NULL, make_keys, &wrong[i]), 0);
    for (int i = 0; i < 4; i++) {
        assert_int_equal(pthread_join(thread[i], NULL), 0);
        assert_int_equal(wrong[i], 0);
    }
}

static void inchi__what_it_cannot_say_is_refused(void **state)
{
    fixture *f = *state;
    char *text, chain[1100];

    assert_int_equal(bs_inchi(&f->cx, &f->home, parse(f, "C*"), false, &text), BS_EVALUE);
    assert_string_equal(f->cx.error.message, "InChI knows no unknown atom (atom 2 is *)");
    assert_null(text);
    memset(chain, 'C', sizeof chain);
    chain[1024] = '\0';
    assert_int_equal(bs_inchi(&f->cx, &f->home, parse(f, chain), false, &text), BS_ELIMIT);
    assert_string_equal(f->cx.error.message,
                        "InChI takes at most 1023 atoms; the molecule has 1024");
    chain[1023] = '\0';
    check_ok(f, bs_inchi(&f->cx, &f->home, parse(f, chain), false, &text));
}

int main(void)
{
    const struct CMUnitTest tests[] = {
        check_case(inchikey__agrees_with_the_reference),
        check_case(inchi__known_molecules),
        check_case(inchi__allenes_keep_their_hand),
        check_case(inchi__cumulenes_keep_their_geometry),
        check_case(inchi__no_memory_is_reported),
        check_case(inchi__threads_wait_for_each_other),
        check_case(inchi__what_it_cannot_say_is_refused),
    };

    return cmocka_run_group_tests(tests, NULL, NULL);
}
