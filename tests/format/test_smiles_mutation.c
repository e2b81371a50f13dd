/*
 * Damaged SMILES: real strings with characters changed, taken out, put in and copied. Whatever
 * comes of it is refused with a place, or read, and then written and read again as the same
 * molecule, from any order of its atoms.
 */
#include "support/table.h"

#include <stdlib.h>

#include "backsaw/format.h"
#include "format/smiles_write.h"

enum { STRINGS = 600, ROUNDS = 6000, LONGEST = 300, ROOM = 400 };

static unsigned next_random(uint64_t *state)
{
    *state = *state * 6364136223846793005u + 1442695040888963407u;
    return (unsigned)(*state >> 33);
}

static void mutate(char *text, uint64_t *seed)
{
    static const char letters[] = "CNOcnosp[]()=#$:/\\@H+-.%0123456789*BrClFIPSeTBOHAL";
    size_t length = strlen(text);

    for (unsigned k = next_random(seed) % 6; k > 0 && length > 0 && length < LONGEST + 50; k--) {
        size_t at = next_random(seed) % length;
        char letter = letters[next_random(seed) % (sizeof letters - 1)];

        switch (next_random(seed) % 3) {
        case 0:
            text[at] = letter;
            break;
        case 1:
            memmove(text + at, text + at + 1, length-- - at);
            break;
        default:
            memmove(text + at + 1, text + at, ++length - at);
            text[at] = letter;
        }
    }
}

/* Writes the molecule with its atoms in a random order. */
static char *shuffled(fixture *f, const bs_mol *mol, uint64_t *seed)
{
    smiles_plan plan = {.cx = &f->cx, .mol = mol};
    bs_mark temp = bs_arena_mark(&f->cx.scratch);
    int count = bs_mol_atom_count(mol);
    int *rank;
    char *out = NULL;

    check_ok(f, bs_new(&f->cx, &f->home, count, &rank));
    for (int i = 0; i < count; i++) {
        int k = (int)(next_random(seed) % (unsigned)(i + 1));

        rank[i] = rank[k];
        rank[k] = i;
    }
    plan.rank = rank;
    check_ok(f, smiles_plan_make(&plan));
    check_ok(f, smiles_write_plan(&plan, false, &f->home, &out, NULL, NULL));
    bs_arena_rewind(&f->cx.scratch, temp);
    return out;
}

static char *canonical(fixture *f, const char *text, const char *origin)
{
    bs_mol *mol;
    char *out;

    if (bs_smiles_read(&f->cx, &f->home, text, strlen(text), NULL, &mol) != BS_OK)
        fail_msg("%s gave %s: %s", origin, text, f->cx.error.message);
    check_ok(f, bs_smiles_canonical(&f->cx, &f->home, mol, 0, &out));
    return out;
}

static void try_string(fixture *f, const char *text, uint64_t *seed)
{
    bs_mol *mol;
    char *out;
    bs_status st = bs_smiles_read(&f->cx, &f->home, text, strlen(text), NULL, &mol);

    if (st != BS_OK) {
        assert_int_not_equal(st, BS_EBUG);
        assert_null(mol);
        assert_in_range(f->cx.error.offset, 0, strlen(text));
        return;
    }
    check_ok(f, bs_smiles_canonical(&f->cx, &f->home, mol, 0, &out));
    if (strcmp(canonical(f, out, text), out) != 0)
        fail_msg("%s gave %s, no fixed point", text, out);
    if (strcmp(canonical(f, shuffled(f, mol, seed), text), out) != 0)
        fail_msg("%s in another order is not %s", text, out);
}

static void damaged__is_refused_or_stays_itself(void **state)
{
    static char strings[STRINGS][ROOM];
    static table t;
    fixture *f = *state;
    uint64_t seed = 2;
    int count = 0;

    table_open(&t, "oracle/molecules.smi.gz");
    for (int line = 0; table_next(&t); line++) {
        if (line % 8 == 0 && count < STRINGS && strlen(t.field[0]) < LONGEST)
            snprintf(strings[count++], ROOM, "%s", t.field[0]);
    }
    assert_int_equal(count, STRINGS);
    for (int round = 0; round < ROUNDS; round++) {
        bs_mark mark = bs_arena_mark(&f->home);
        char text[ROOM];

        memcpy(text, strings[next_random(&seed) % STRINGS], ROOM);
        mutate(text, &seed);
        try_string(f, text, &seed);
        assert_int_equal(f->cx.scratch.live, 0);
        bs_arena_rewind(&f->home, mark);
    }
}

int main(void)
{
    const struct CMUnitTest tests[] = {check_case(damaged__is_refused_or_stays_itself)};

    return cmocka_run_group_tests(tests, NULL, NULL);
}
