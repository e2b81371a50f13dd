/* Symbols, atomic weights and isotope masses against the tables they were taken from. */
#include "support/check.h"

#include <stdio.h>
#include <stdlib.h>
#include <string.h>

#include "chem/element.h"

static void element__symbols_and_numbers_agree(void **state)
{
    (void)state;
    for (int z = 0; z < BS_ELEMENT_COUNT; z++) {
        const char *symbol = bs_element_symbol(z);

        assert_int_equal(bs_element_number(symbol, strlen(symbol)), z);
    }
    assert_int_equal(bs_element_number("Cl", 2), 17);
    assert_int_equal(bs_element_number("CL", 2), -1);
    assert_int_equal(bs_element_number("Xq", 2), -1);
    assert_int_equal(bs_element_number("", 0), -1);
    assert_null(bs_element_symbol(119));
    assert_null(bs_element_symbol(-1));
}

/* tests/data/checks/atomic-weights.tsv: abridged standard atomic weights 2021, IUPAC CIAAW. */
static void element__weights_are_the_abridged_ones(void **state)
{
    FILE *file = fopen(BACKSAW_TEST_DATA "/checks/atomic-weights.tsv", "r");
    char line[300];
    int count = 0;

    (void)state;
    assert_non_null(file);
    assert_non_null(fgets(line, sizeof line, file));
    while (fgets(line, sizeof line, file)) {
        char *field[6];
        char *at = line;

        for (int i = 0; i < 6; i++) {
            field[i] = at;
            at = strchr(at, '\t');
            assert_non_null(at);
            *at++ = '\0';
        }
        assert_string_equal(bs_element_symbol(atoi(field[0])), field[1]);
        assert_true(bs_element__weight(atoi(field[0])) == strtod(field[5], NULL));
        count++;
    }
    fclose(file);
    assert_int_equal(count, 84);
    assert_true(bs_element__weight(43) == 0); /* technetium has no standard weight */
}

/* AME2020: M. Wang et al., Chin. Phys. C 2021, 45, 030003. */
static void isotope__masses(void **state)
{
    (void)state;
    assert_true(bs_isotope__mass(1, 2) > 2.0141017 && bs_isotope__mass(1, 2) < 2.0141018);
    assert_true(bs_element__main_mass(6) == 12.0);
    assert_true(bs_element__main_mass(35) > 78.9183 && bs_element__main_mass(35) < 78.9184);
    assert_true(bs_isotope__mass(17, 99) == 99); /* not in the table: the mass number */
}

int main(void)
{
    const struct CMUnitTest tests[] = {
        check_case(element__symbols_and_numbers_agree),
        check_case(element__weights_are_the_abridged_ones),
        check_case(isotope__masses),
    };

    return cmocka_run_group_tests(tests, NULL, NULL);
}
