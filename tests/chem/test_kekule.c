/*
 * Kekulé forms against a search by trial: no aromatic part that can be assigned is refused, and
 * none that cannot is accepted.
 */
#include "support/check.h"

#include <stdio.h>
#include <string.h>

#include "backsaw/draft.h"
#include "backsaw/format.h"

enum { MOST = 14 };

/* A part of aromatic atoms, some of which need a double bond and some of which have no room. */
typedef struct part {
    int count;
    bool needs[MOST];
    bool bonded[MOST][MOST];
} part;

static unsigned next_random(unsigned *state)
{
    *state = *state * 1664525u + 1013904223u;
    return *state >> 10;
}

/* Rings glued together at random: each new ring shares a bond or an atom, or bridges. */
static void make_part(part *p, unsigned *state)
{
    memset(p, 0, sizeof *p);
    p->count = 3 + (int)(next_random(state) % 5);
    for (int i = 0; i < p->count; i++)
        p->bonded[i][(i + 1) % p->count] = p->bonded[(i + 1) % p->count][i] = true;
    while (p->count < MOST - 4 && next_random(state) % 4 != 0) {
        int from = (int)(next_random(state) % (unsigned)p->count);
        int to = (int)(next_random(state) % (unsigned)p->count);
        int size = 1 + (int)(next_random(state) % 4);
        int last = from;

        if (from == to)
            continue;
        for (int k = 0; k < size; k++) {
            p->bonded[last][p->count] = p->bonded[p->count][last] = true;
            last = p->count++;
        }
        p->bonded[last][to] = p->bonded[to][last] = true;
    }
    for (int i = 0; i < p->count; i++)
        p->needs[i] = next_random(state) % 5 != 0;
}

/* Whether the atoms that need one can all have a double bond; tries every choice. */
static bool can_match(const part *p, bool *done)
{
    int first = 0;

    while (first < p->count && (done[first] || !p->needs[first]))
        first++;
    if (first == p->count)
        return true;
    done[first] = true;
    for (int i = first + 1; i < p->count; i++) {
        if (!p->bonded[first][i] || done[i] || !p->needs[i])
            continue;
        done[i] = true;
        if (can_match(p, done))
            return true;
        done[i] = false;
    }
    done[first] = false;
    return false;
}

static bs_status finish_part(fixture *f, const part *p, bs_mol **mol)
{
    bs_draft draft;

    bs_draft_init(&draft, &f->cx, &f->home);
    for (int i = 0; i < p->count; i++) {
        int degree = 0;

        for (int k = 0; k < p->count; k++)
            degree += p->bonded[i][k];
        /* Hydrogens are stated so that one valence is left, or none. */
        check_ok(f, bs_draft_add_atom(
                        &draft,
                        (bs_draft_atom){.element = 6,
                                        .hydrogens = (int16_t)((p->needs[i] ? 3 : 4) - degree),
                                        .aromatic = true},
                        NULL));
    }
    for (int i = 0; i < p->count; i++) {
        for (int k = 0; k < i; k++) {
            if (p->bonded[i][k])
                check_ok(f, bs_draft_add_bond(&draft, (uint32_t)i, (uint32_t)k,
                                              BS_DRAFT_ORDER_AROMATIC, NULL));
        }
    }
    return bs_draft_finish(&draft, &f->home, NULL, mol);
}

/* Parts whose atoms have more neighbours than carbon has valences are passed over. */
static bool is_possible(const part *p)
{
    for (int i = 0; i < p->count; i++) {
        int degree = 0;

        for (int k = 0; k < p->count; k++)
            degree += p->bonded[i][k];
        if (degree > (p->needs[i] ? 3 : 4))
            return false;
    }
    return true;
}

static void check_orders(const part *p, const bs_mol *mol)
{
    for (int i = 0; i < p->count; i++) {
        int doubles = 0;

        for (int k = 0; k < bs_mol_atom_degree(mol, i); k++) {
            int bond;

            bs_mol_neighbour(mol, i, k, NULL, &bond);
            doubles += bs_mol_bond_order(mol, bond) == 2;
        }
        assert_int_equal(doubles, p->needs[i] ? 1 : 0);
    }
}

static void kekule__agrees_with_a_search_by_trial(void **state)
{
    fixture *f = *state;
    unsigned seed = 20;
    int placed = 0;
    int refused = 0;

    for (int round = 0; round < 6000; round++) {
        bs_mark mark = bs_arena_mark(&f->home);
        bool done[MOST] = {false};
        bs_mol *mol;
        bs_status st;
        part p;

        make_part(&p, &seed);
        if (!is_possible(&p))
            continue;
        st = finish_part(f, &p, &mol);
        if (can_match(&p, done)) {
            check_ok(f, st);
            check_orders(&p, mol);
            placed++;
        } else {
            assert_int_equal(st, BS_EVALUE);
            assert_true(f->cx.error.offset >= 0 && f->cx.error.offset < p.count);
            assert_true(p.needs[f->cx.error.offset]);
            refused++;
        }
        bs_arena_rewind(&f->home, mark);
    }
    assert_true(placed > 300);
    assert_true(refused > 300);
}

/* Hexabenzocoronene, coronene, fluoranthene, pyracylene, corannulene: textbook aromatics. */
static void kekule__large_systems(void **state)
{
    fixture *f = *state;
    const char *texts[] = {
        "c1cc2c3ccccc3c3ccccc3c2c2ccccc12",
        "c1cc2ccc3ccc4ccc5ccc6ccc1c7c2c3c4c5c67",
        "c1ccc2c(c1)c1cccc3cccc2c31",
        "C1=Cc2ccc3C=Cc4ccc1c2c34",
        "c1cc2ccc3ccc4ccc5ccc1c1c2c3c4c51",
        "c1ccc*c1",
        "c1cc[n+]([O-])cc1",
        "[cH-]1cccc1",
        "c1ccc[cH+]cc1",
    };

    for (size_t i = 0; i < sizeof texts / sizeof texts[0]; i++) {
        bs_mol *mol;

        check_ok(f, bs_smiles_read(&f->cx, &f->home, texts[i], strlen(texts[i]), NULL, &mol));
    }
}

/*
 * Bicyclo[6.2.0]decapentaene: the rim is aromatic with ten electrons, and of its Kekulé forms one
 * has the middle bond double. All of them are one compound.
 */
static void kekule__a_double_bond_inside_moves_to_the_rim(void **state)
{
    fixture *f = *state;
    const char *forms[] = {"C1=CC=CC=CC2=C1C=C2", "C1=CC2=CC=CC=CC=C12", "C1=CC=CC=C2C=CC2=C1"};
    char *first = NULL;

    for (int i = 0; i < 3; i++) {
        bs_mol *mol;
        char *text;

        check_ok(f, bs_smiles_read(&f->cx, &f->home, forms[i], strlen(forms[i]), NULL, &mol));
        check_ok(f, bs_smiles_canonical(&f->cx, &f->home, mol, 0, &text));
        if (!first)
            first = text;
        assert_string_equal(text, first);
    }
}

int main(void)
{
    const struct CMUnitTest tests[] = {
        check_case(kekule__agrees_with_a_search_by_trial),
        check_case(kekule__large_systems),
        check_case(kekule__a_double_bond_inside_moves_to_the_rim),
    };

    return cmocka_run_group_tests(tests, NULL, NULL);
}
