/*
 * Doubts about molecules. What is usual is the valence model of OpenSMILES; what can be a stereo
 * element is common practice, no source.
 */
#include "support/molecule.h"

#include "backsaw/mol.h"

/* All doubts, joined by bars. */
static void check_doubts(fixture *f, const char *smiles, const char *expected)
{
    char all[2000] = "", **texts;
    int count;

    check_ok(f, bs_mol_doubts(&f->cx, &f->home, molecule_read(f, smiles), &texts, &count));
    for (int i = 0; i < count; i++) {
        if (i > 0)
            strcat(all, "|");
        assert_true(strlen(all) + strlen(texts[i]) + 2 < sizeof all);
        strcat(all, texts[i]);
    }
    assert_string_equal(all, expected);
}

static void doubts__none_about_usual_molecules(void **state)
{
    static const char *const usual[] = {
        "C",
        "CCO",
        "C[N+](C)(C)C",
        "CS(C)(=O)=O",
        "[Na+].[Cl-]",
        "C[C@H](N)O",
        "F/C=C/F",
        "c1ccccc1",
        "C[C@H]1CC[C@@H](C)CC1",
        "O=S(=O)(O)O",
        "[O-][N+](=O)c1ccccc1",
        "FC(F)=C[C@@H](O)C",
        "[Fe]",
        "C/C=C(/C)CC",
        "CC/N=C/c1ccccc1",
        "B(O)O",
        "CP(C)(C)=O",
    };

    for (size_t i = 0; i < sizeof usual / sizeof *usual; i++)
        check_doubts(*state, usual[i], "");
}

static void doubts__strange_valences(void **state)
{
    check_doubts(*state, "CC(C)(C)(C)C", "atom 2 (C): a valence of 5 is unusual");
    check_doubts(*state, "C[N+](C)(C)(C)C", "atom 2 (N+): a valence of 5 is unusual");
    check_doubts(*state, "[CH3]", "atom 1 (C): a valence of 3 is unusual");
    check_doubts(*state, "*C", "atom 1 (*): its element is unknown");
}

static void doubts__marks_that_mean_nothing(void **state)
{
    check_doubts(*state, "C[C@H](C)O", "atom 2 (C): it was marked as a stereo centre, but is none");
    check_doubts(*state, "C/C=C(/C)C",
                 "atoms 2 and 3: their double bond was marked as cis or trans, "
                 "but is neither");
    check_doubts(*state, "[C@H3]O", "atom 1 (C): it was marked as a stereo centre, but is none");
}

static void doubts__every_failed_request_is_rolled_back(void **state)
{
    fixture *f = *state;
    bs_mol *mol = molecule_read(f, "CC(C)(C)(C)[C@H](C)C");
    size_t live = f->home.live;
    char **texts;
    int count;
    long i = 0;

    for (;; i++) {
        bs_status st;

        atomic_store(&f->cx.gate->fail_after, i);
        st = bs_mol_doubts(&f->cx, &f->home, mol, &texts, &count);
        atomic_store(&f->cx.gate->fail_after, -1);
        if (st == BS_OK)
            break;
        assert_int_equal(st, BS_ENOMEM);
        assert_null(texts);
        assert_int_equal(f->home.live, live);
    }
    check_requests(i, 3);
    assert_int_equal(count, 2);
}

int main(void)
{
    const struct CMUnitTest tests[] = {
        check_case(doubts__none_about_usual_molecules),
        check_case(doubts__strange_valences),
        check_case(doubts__marks_that_mean_nothing),
        check_case(doubts__every_failed_request_is_rolled_back),
    };

    return cmocka_run_group_tests(tests, NULL, NULL);
}
