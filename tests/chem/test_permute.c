/* Perms of stereo centres when the neighbours are named in another order. */
#include "support/check.h"

#include <string.h>

#include "backsaw/format.h"
#include "chem/stereo.h"

static char *canonical(fixture *f, const char *text)
{
    bs_mol *mol;
    char *out;

    check_ok(f, bs_smiles_read(&f->cx, &f->home, text, strlen(text), NULL, &mol));
    check_ok(f, bs_smiles_canonical(&f->cx, &f->home, mol, 0, &out));
    return out;
}

/* Spellings of one octahedron, from memory of the OpenSMILES specification; RDKit agrees. */
static void octahedron__spellings_of_the_specification(void **state)
{
    static const char *const same[] = {
        "C[Co@](F)(Cl)(Br)(I)S",     "F[Co@@](S)(I)(C)(Cl)Br",    "S[Co@OH5](F)(I)(Cl)(C)Br",
        "Br[Co@OH9](C)(S)(Cl)(F)I",  "Br[Co@OH12](Cl)(I)(F)(S)C", "Cl[Co@OH15](C)(Br)(F)(I)S",
        "Cl[Co@OH19](C)(I)(F)(S)Br", "I[Co@OH27](Cl)(Br)(F)(S)C",
    };
    fixture *f = *state;

    for (size_t i = 1; i < sizeof same / sizeof same[0]; i++)
        assert_string_equal(canonical(f, same[i]), canonical(f, same[0]));
}

/* Square shapes of the specification: U, 4 and Z name the same complex. */
static void square__shapes(void **state)
{
    fixture *f = *state;

    assert_string_equal(canonical(f, "F[Pt@SP2](Br)(Cl)I"), canonical(f, "F[Pt@SP1](Cl)(Br)I"));
    assert_string_equal(canonical(f, "F[Pt@SP3](Cl)(I)Br"), canonical(f, "F[Pt@SP1](Cl)(Br)I"));
    assert_string_not_equal(canonical(f, "F[Pt@SP2](Cl)(Br)I"), canonical(f, "F[Pt@SP1](Cl)(Br)I"));
}

/* Changing the order and back gives the perm again, and every perm can be reached or none. */
static void permute__there_and_back(void **state)
{
    static const int sizes[] = {0, 4, 4, 4, 5, 6};
    unsigned seed = 5;

    (void)state;
    for (int kind = BS_STEREO_TETRAHEDRAL; kind <= BS_STEREO_OCTAHEDRON; kind++) {
        uint32_t from[6] = {10, 11, 12, 13, 14, 15};
        int count = sizes[kind];

        for (int round = 0; round < 25; round++) {
            uint32_t to[6];
            bool reached[31] = {false};

            memcpy(to, from, sizeof to);
            for (int k = count - 1; k > 0; k--) {
                int other;
                uint32_t swap = to[k];

                seed = seed * 1664525u + 1013904223u;
                other = (int)((seed >> 12) % (unsigned)(k + 1));
                to[k] = to[other];
                to[other] = swap;
            }
            for (int perm = 1; perm <= bs_stereo__perm_count(kind); perm++) {
                int there = bs_stereo__permute(kind, perm, count, from, to);

                assert_in_range(there, 1, bs_stereo__perm_count(kind));
                assert_false(reached[there]);
                reached[there] = true;
                assert_int_equal(bs_stereo__permute(kind, there, count, to, from), perm);
            }
        }
    }
}

static void permute__other_neighbours_have_no_perm(void **state)
{
    const uint32_t from[4] = {1, 2, 3, 4};
    const uint32_t strange[4] = {1, 2, 3, 5};
    const uint32_t twice[4] = {1, 2, 3, 3};

    (void)state;
    assert_int_equal(bs_stereo__permute(BS_STEREO_TETRAHEDRAL, 1, 4, from, strange), 0);
    assert_int_equal(bs_stereo__permute(BS_STEREO_TETRAHEDRAL, 1, 4, twice, twice), 0);
}

int main(void)
{
    const struct CMUnitTest tests[] = {
        check_case(octahedron__spellings_of_the_specification),
        check_case(square__shapes),
        check_case(permute__there_and_back),
        check_case(permute__other_neighbours_have_no_perm),
    };

    return cmocka_run_group_tests(tests, NULL, NULL);
}
