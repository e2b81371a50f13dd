/*
 * Fuzz entry of the SMARTS compiler and the matcher: a pattern that is written and read again finds
 * the same number of matches in each molecule.
 */
#include "target.h"

#include "match/query.h"

static const char *const molecules[] = {
    "CC(=O)Nc1ccc(O)cc1",
    "C[C@H](N)C(=O)N1CCC[C@H]1C(=O)O",
    "F/C=C/[C@@](Cl)(Br)I.[Na+].[O-]C#N",
    "[2H]c1[nH]c2ccccc2c1CC=[C@]=CC",
    "C12C3C4C1C5C2C3C45",
    "O=S(=O)(c1cnn(C)c1)N1C2CCC1CC2",
};

/* Matches by the pattern; -1 if the budget does not do. */
static int count(target *t, const bs_pattern *pattern, const bs_mol *mol)
{
    bs_match_opts opts = {.steps = 20000};
    bs_matches found;

    if (bs_pattern_find(&t->cx, &t->home, pattern, mol, &opts, &found) != BS_OK)
        return -1;
    return found.count;
}

static void compare(target *t, const bs_pattern *one, const bs_pattern *other, const char *text)
{
    for (size_t i = 0; i < sizeof molecules / sizeof *molecules; i++) {
        const bs_mol *mol = target_read(t, molecules[i], strlen(molecules[i]));
        int first = count(t, one, mol), second = count(t, other, mol);

        if (first != second && first >= 0 && second >= 0)
            target_fail(t, "other matches", text, molecules[i]);
    }
}

int LLVMFuzzerTestOneInput(const uint8_t *data, size_t size)
{
    target t;
    bs_pattern *one, *other;
    char *text;

    target_open(&t);
    if (bs_pattern_read(&t.cx, &t.home, (const char *)data, size, &one) == BS_OK &&
        bs_query_write(&t.cx, &t.home, bs_pattern__query(one), &text) == BS_OK) {
        bs_status st = bs_pattern_read(&t.cx, &t.home, text, strlen(text), &other);

        if (st != BS_OK && st != BS_ELIMIT)
            target_fail(&t, "pattern written, but not read", text, "nothing");
        if (st == BS_OK)
            compare(&t, one, other, text);
    }
    target_close(&t);
    return 0;
}
