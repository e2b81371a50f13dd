/* The guess that leads the exploration: its order, not its numbers, is what counts. */
#include "support/check.h"

#include <string.h>

#include "backsaw/format.h"
#include "search/guess.h"

static double steps(fixture *f, const char *smiles)
{
    bs_mol *mol;

    check_ok(f, bs_smiles_read(&f->cx, &f->home, smiles, strlen(smiles), NULL, &mol));
    return bs_guess_steps(mol);
}

static void guess__grows_with_what_is_hard_to_make(void **state)
{
    fixture *f = *state;

    assert_true(steps(f, "CCO") == 0);
    assert_true(steps(f, "CCCCCCCCCCCC") < steps(f, "CCCCCCCCCCCCCCCC"));
    assert_true(steps(f, "CC(O)CCCCCCCCC") < steps(f, "C[C@H](O)CCCCCCCCC"));
    assert_true(steps(f, "CCCCCCCCCCC=CC") < steps(f, "CCCCCCCCCC/C=C/C"));
    assert_true(steps(f, "CCCCCCCCCCCC") < steps(f, "C1CCC2CCCCC2CCC1"));
}

/* A cut in the middle takes more off than one at the rim. */
static void guess__favours_a_cut_in_the_middle(void **state)
{
    fixture *f = *state;
    double whole = steps(f, "CCCCCCCCCCCCCCCCCCCC");
    double middle = 2 * steps(f, "CCCCCCCCCC");
    double rim = steps(f, "CCCCCCCCCCCCCCCCCC") + steps(f, "CC");

    assert_true(middle < rim);
    assert_true(rim < whole);
}

int main(void)
{
    const struct CMUnitTest tests[] = {
        check_case(guess__grows_with_what_is_hard_to_make),
        check_case(guess__favours_a_cut_in_the_middle),
    };

    return cmocka_run_group_tests(tests, NULL, NULL);
}
