/*
 * CIP labels against tests/data/oracle/cip.tsv (its source stands in the README beside it), and
 * labels of textbook compounds.
 */
#include <stdlib.h>

#include "support/check.h"
#include "support/table.h"

#include "backsaw/format.h"
#include "backsaw/mol.h"

static bs_mol *parse(fixture *f, const char *smiles)
{
    bs_mol *mol = NULL;

    check_ok(f, bs_smiles_read(&f->cx, &f->home, smiles, strlen(smiles), NULL, &mol));
    return mol;
}

/* Writes the labels as the table has them: "2:R 4=5:Z", in the order of the first atoms. */
static void write_labels(fixture *f, const bs_mol *mol, char *out, size_t size)
{
    char *atoms, *bonds;
    size_t at = 0;

    out[0] = '\0';
    check_ok(f, bs_mol_cip(&f->cx, &f->home, mol, &atoms, &bonds));
    for (int i = 0; i < bs_mol_atom_count(mol); i++) {
        if (atoms[i])
            at += (size_t)snprintf(out + at, size - at, "%s%d:%c", at ? " " : "", i + 1, atoms[i]);
        for (int k = 0; k < bs_mol_atom_degree(mol, i); k++) {
            int other, bond;

            bs_mol_neighbour(mol, i, k, &other, &bond);
            if (other > i && bonds[bond])
                at += (size_t)snprintf(out + at, size - at, "%s%d=%d:%c", at ? " " : "", i + 1,
                                       other + 1, bonds[bond]);
        }
    }
}

static void cip__agrees_with_the_reference(void **state)
{
    fixture *f = *state;
    static table t;
    char text[512];
    int rows = 0, wrong = 0;

    table_open(&t, "oracle/cip.tsv");
    assert_true(table_next(&t));
    while (table_next(&t)) {
        write_labels(f, parse(f, t.field[1]), text, sizeof text);
        rows++;
        if (strcmp(text, t.field[2]) == 0)
            continue;
        wrong++;
        print_message("%s %s\n  got  %s\n  want %s (%s)\n", t.field[0], t.field[1], text, t.field[2], t.field[5]);
    }
    assert_int_equal(rows, 100);
    assert_int_equal(wrong, 0);
}

int main(void)
{
    const struct CMUnitTest tests[] = {
        check_case(cip__agrees_with_the_reference),
    };

    return cmocka_run_group_tests(tests, NULL, NULL);
}
