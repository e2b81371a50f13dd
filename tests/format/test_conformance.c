/*
 * The SMILES reader against tests/data/oracle/smiles-conformance.tsv: strings that OpenSMILES
 * allows or forbids, with formula, charge and another spelling.
 */
#include "support/table.h"

#include <stdlib.h>

#include "backsaw/format.h"

/* Turns <SPACE> and <TAB> into the characters. */
static size_t unfold(const char *text, char *out)
{
    size_t n = 0;

    while (*text) {
        if (strncmp(text, "<SPACE>", 7) == 0) {
            out[n++] = ' ';
            text += 7;
        } else if (strncmp(text, "<TAB>", 5) == 0) {
            out[n++] = '\t';
            text += 5;
        } else {
            out[n++] = *text++;
        }
    }
    out[n] = '\0';
    return n;
}

static char *canonical(fixture *f, const char *text, size_t length)
{
    bs_mol *mol;
    char *out;

    check_ok(f, bs_smiles_read(&f->cx, &f->home, text, length, NULL, &mol));
    check_ok(f, bs_smiles_canonical(&f->cx, &f->home, mol, 0, &out));
    return out;
}

static void check_valid(fixture *f, const table *t, const char *text, size_t length)
{
    bs_mol *mol;
    char *formula;

    if (bs_smiles_read(&f->cx, &f->home, text, length, NULL, &mol) != BS_OK)
        fail_msg("%s %s: %s", t->field[0], text, f->cx.error.message);
    if (strcmp(t->field[3], "-") != 0) {
        check_ok(f, bs_mol_formula(&f->cx, &f->home, mol, &formula));
        if (strcmp(formula, t->field[3]) != 0 || bs_mol_charge(mol) != atoi(t->field[4]))
            fail_msg("%s %s: %s %d", t->field[0], text, formula, bs_mol_charge(mol));
    }
    if (strcmp(t->field[5], "-") != 0)
        assert_string_equal(canonical(f, text, length),
                            canonical(f, t->field[5], strlen(t->field[5])));
}

static void conformance__every_string_is_read_or_refused(void **state)
{
    static table t;
    fixture *f = *state;
    int lines = 0;

    table_open(&t, "oracle/smiles-conformance.tsv");
    assert_true(table_next(&t));
    while (table_next(&t)) {
        char text[500];
        size_t length = unfold(t.field[1], text);
        bs_mol *mol;

        lines++;
        if (strcmp(t.field[2], "valid") == 0) {
            check_valid(f, &t, text, length);
            continue;
        }
        if (bs_smiles_read(&f->cx, &f->home, text, length, NULL, &mol) == BS_OK)
            fail_msg("%s %s was read", t.field[0], text);
        assert_null(mol);
        assert_true(f->cx.error.offset >= 0 && (size_t)f->cx.error.offset <= length);
    }
    assert_int_equal(lines, 197);
}

int main(void)
{
    const struct CMUnitTest tests[] = {check_case(conformance__every_string_is_read_or_refused)};

    return cmocka_run_group_tests(tests, NULL, NULL);
}
