/*
 * CIP labels against tests/data/oracle/cip.tsv (its source stands in the README beside it), labels
 * of well-known compounds, and properties that labels must have.
 *
 * All 100 rows agree; there is no list of exceptions. Row stc040 settles one choice: a phosphoryl
 * oxygen gives no duplicate to phosphorus, nor the other way round (Prelog and Helmchen 1982
 * neglect d orbitals).
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
    int rows = 0;

    table_open(&t, "oracle/cip.tsv");
    assert_true(table_next(&t));
    while (table_next(&t)) {
        write_labels(f, parse(f, t.field[1]), text, sizeof text);
        if (strcmp(text, t.field[2]) != 0)
            fail_msg("%s %s (%s): %s, expected %s", t.field[0], t.field[1], t.field[5], text,
                     t.field[2]);
        rows++;
    }
    assert_int_equal(rows, 100);
}

/* Names of the compounds in brackets; structures and descriptors from memory. */
static void cip__known_compounds(void **state)
{
    static const char *const known[][2] = {
        /* (2S,5R,6R): benzylpenicillin */
        {"CC1([C@@H](N2[C@H](S1)[C@@H](C2=O)NC(=O)CC3=CC=CC=C3)C(=O)O)C", "3:S 5:R 7:R"},
        /* (2R,3R): L-tartaric acid, and (2R,3S): the meso form */
        {"OC(=O)[C@H](O)[C@@H](O)C(=O)O", "4:R 6:R"},
        {"OC(=O)[C@H](O)[C@H](O)C(=O)O", "4:R 6:S"},
        /* (S)-lactic acid */
        {"C[C@H](O)C(=O)O", "2:S"},
        /* no stereo, no label */
        {"CC(O)C=CC", ""},
        /* an allene has a hand, but no label of these */
        {"CC=[C@]=CC", ""},
    };
    fixture *f = *state;
    char text[512];

    for (size_t i = 0; i < sizeof known / sizeof *known; i++) {
        write_labels(f, parse(f, known[i][0]), text, sizeof text);
        assert_string_equal(text, known[i][1]);
    }
}

/* Counts the labels R, S, r, s, E, Z. */
static void count_labels(fixture *f, const bs_mol *mol, int counts[6])
{
    static const char letters[] = "RSrsEZ";
    char text[512];

    memset(counts, 0, 6 * sizeof *counts);
    write_labels(f, mol, text, sizeof text);
    for (const char *c = text; *c; c++)
        if (strchr(letters, *c))
            counts[strchr(letters, *c) - letters]++;
}

static void cip__labels_do_not_depend_on_the_order_of_atoms(void **state)
{
    fixture *f = *state;
    static table t;

    table_open(&t, "oracle/cip.tsv");
    assert_true(table_next(&t));
    while (table_next(&t)) {
        const bs_mol *mol = parse(f, t.field[1]);
        int counts[6], again[6];
        char *smiles;

        check_ok(f, bs_smiles_canonical(&f->cx, &f->home, mol, 0, &smiles));
        count_labels(f, mol, counts);
        count_labels(f, parse(f, smiles), again);
        assert_memory_equal(counts, again, sizeof counts);
    }
}

/* Turns every centre of a SMILES over. */
static void mirror(const char *smiles, char *out)
{
    while (*smiles) {
        if (*smiles != '@') {
            *out++ = *smiles++;
            continue;
        }
        *out++ = '@';
        if (smiles[1] != '@')
            *out++ = '@';
        smiles += smiles[1] == '@' ? 2 : 1;
    }
    *out = '\0';
}

/* R and S change places in a mirror; r, s, E and Z stay (no row has an E or Z that rests on rule 5). */
static void cip__mirror_image_exchanges_only_capitals(void **state)
{
    fixture *f = *state;
    static table t;
    char text[512], image[512], turned[1024];

    table_open(&t, "oracle/cip.tsv");
    assert_true(table_next(&t));
    while (table_next(&t)) {
        mirror(t.field[1], turned);
        write_labels(f, parse(f, t.field[1]), text, sizeof text);
        write_labels(f, parse(f, turned), image, sizeof image);
        for (char *c = image; *c; c++)
            *c = (char)(*c == 'R' ? 'S' : *c == 'S' ? 'R' : *c);
        assert_string_equal(text, image);
    }
}

/* Two rails of fused four-membered rings, with a mark at the far end. */
static void add_ladder(bs_text *text, int rungs, const char *mark)
{
    for (int i = 0; i < rungs - 1; i++)
        bs_text_printf(text, "C%%%d", 10 + i);
    bs_text_printf(text, "C(%s)C", mark);
    for (int i = rungs - 2; i >= 0; i--)
        bs_text_printf(text, "C%%%d", 10 + i);
}

static bs_mol *two_ladders(fixture *f, int rungs)
{
    bs_text text;
    bs_mol *mol;

    bs_text_init(&text, &f->cx);
    check_ok(f, bs_text_puts(&text, "C[C@H]("));
    add_ladder(&text, rungs, "F");
    check_ok(f, bs_text_puts(&text, ")"));
    add_ladder(&text, rungs, "Cl");
    mol = parse(f, text.data);
    bs_text_free(&text);
    return mol;
}

/* The number of paths doubles with each rung: a few are labelled, many are refused in time. */
static void cip__too_many_paths_are_refused(void **state)
{
    fixture *f = *state;
    char *atoms, *bonds;
    const bs_mol *mol = two_ladders(f, 4);
    size_t live;

    check_ok(f, bs_mol_cip(&f->cx, &f->home, mol, &atoms, &bonds));
    assert_true(atoms[1] == 'R' || atoms[1] == 'S');
    mol = two_ladders(f, 40);
    live = f->home.live;
    assert_int_equal(bs_mol_cip(&f->cx, &f->home, mol, &atoms, &bonds), BS_ELIMIT);
    assert_non_null(strstr(f->cx.error.message, "for CIP labels"));
    assert_int_equal(f->home.live, live);
    assert_null(atoms);
}

/* A centre whose ligands differ only after two thousand atoms: by rule 1a, fluorine is above. */
static void cip__long_chains_are_followed(void **state)
{
    enum { LENGTH = 2000 };
    fixture *f = *state;
    bs_text text;
    char *atoms, *bonds;

    bs_text_init(&text, &f->cx);
    check_ok(f, bs_text_puts(&text, "F"));
    for (int i = 0; i < LENGTH; i++)
        check_ok(f, bs_text_putc(&text, 'C'));
    /* Seen from the chain with fluorine: hydrogen, oxygen, the other chain anticlockwise. */
    check_ok(f, bs_text_puts(&text, "[C@H](O)"));
    for (int i = 0; i < LENGTH; i++)
        check_ok(f, bs_text_putc(&text, 'C'));
    check_ok(f, bs_mol_cip(&f->cx, &f->home, parse(f, text.data), &atoms, &bonds));
    assert_int_equal(atoms[LENGTH + 1], 'R');
    bs_text_free(&text);
}

static void cip__every_failed_allocation_is_rolled_back(void **state)
{
    fixture *f = *state;
    const bs_mol *mol = parse(f, "C[C@H](O)[C@H](Cl)[C@@H](C)O");
    size_t live = f->home.live;
    char *atoms, *bonds;
    bs_status st = BS_ENOMEM;

    for (long n = 0; st != BS_OK; n++) {
        assert_true(n < 1000);
        bs_ctx_free(&f->cx);
        atomic_store(&f->cx.gate->fail_after, n);
        st = bs_mol_cip(&f->cx, &f->home, mol, &atoms, &bonds);
        atomic_store(&f->cx.gate->fail_after, -1);
        if (st == BS_OK)
            break;
        assert_int_equal(st, BS_ENOMEM);
        assert_int_equal(f->home.live, live);
        assert_int_equal(f->cx.scratch.live, 0);
    }
    assert_int_equal(atoms[3], 's');
}

int main(void)
{
    const struct CMUnitTest tests[] = {
        check_case(cip__agrees_with_the_reference),
        check_case(cip__known_compounds),
        check_case(cip__labels_do_not_depend_on_the_order_of_atoms),
        check_case(cip__mirror_image_exchanges_only_capitals),
        check_case(cip__too_many_paths_are_refused),
        check_case(cip__long_chains_are_followed),
        check_case(cip__every_failed_allocation_is_rolled_back),
    };

    return cmocka_run_group_tests(tests, NULL, NULL);
}
