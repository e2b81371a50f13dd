/* Written SMILES: read back they are the same molecule, and canonical ones are equal for equals. */
#include "support/table.h"

#include <stdlib.h>

#include "backsaw/format.h"

/* Under the sanitizers a share of the large tables is enough: the plain build runs all of it. */
#ifdef BS_ARENA_DEBUG
enum { SHARE = 5 };
#else
enum { SHARE = 1 };
#endif

static bs_mol *read_mol(fixture *f, const char *text)
{
    bs_mol *mol;

    check_ok(f, bs_smiles_read(&f->cx, &f->home, text, strlen(text), NULL, &mol));
    return mol;
}

static char *canonical(fixture *f, const char *text)
{
    char *out;

    check_ok(f, bs_smiles_canonical(&f->cx, &f->home, read_mol(f, text), 0, &out));
    return out;
}

static char *plain(fixture *f, const char *text)
{
    char *out;

    check_ok(f, bs_smiles_write(&f->cx, &f->home, read_mol(f, text), BS_SMILES_LABELS, &out));
    return out;
}

static void written__reads_back_as_the_same_molecule(void **state)
{
    static table t;
    fixture *f = *state;
    int lines = 0;

    table_open(&t, "oracle/molecules.smi.gz");
    while (table_next(&t)) {
        bs_mark mark = bs_arena_mark(&f->home);
        char *wanted;

        if (lines++ % SHARE != 0)
            continue;
        wanted = canonical(f, t.field[0]);
        assert_string_equal(canonical(f, wanted), wanted);
        assert_string_equal(canonical(f, plain(f, t.field[0])), wanted);
        bs_arena_rewind(&f->home, mark);
    }
    assert_int_equal(lines, 5000);
}

/*
 * A spelling that its writer got wrong: in chembl20-53621 number 6, "C1(\CO...)(/N=1)..." has the
 * chain and the carbon of N on one side of the double bond, in all others they are trans. The
 * reference toolkit itself reads it as another isomer than the rest.
 */
static bool is_misspelt(const table *t)
{
    return strcmp(t->field[0], "chembl20-53621") == 0 && strcmp(t->field[1], "6") == 0;
}

static void canonical__does_not_depend_on_the_spelling(void **state)
{
    static table t;
    fixture *f = *state;
    char id[100] = "";
    char *wanted = NULL;
    int lines = 0;

    table_open(&t, "oracle/randomized.tsv.gz");
    assert_true(table_next(&t));
    while (table_next(&t)) {
        bs_mark mark;

        lines++;
        if (is_misspelt(&t) || (lines / 12) % SHARE != 0)
            continue;
        if (strcmp(id, t.field[0]) != 0) {
            snprintf(id, sizeof id, "%s", t.field[0]);
            wanted = canonical(f, t.field[3]);
        }
        mark = bs_arena_mark(&f->home);
        assert_string_equal(canonical(f, t.field[3]), wanted);
        bs_arena_rewind(&f->home, mark);
    }
    assert_int_equal(lines, 12000);
}

/*
 * st102 has both neighbours of one atom on the same side of its double bond, which OpenSMILES
 * forbids (c160 of the conformance list): it is refused, where the references drop the mark.
 */
static bool is_contradictory(const table *t)
{
    return strcmp(t->field[0], "st102") == 0;
}

static void canonical__tells_stereoisomers_apart(void **state)
{
    static table t;
    fixture *f = *state;
    int lines = 0;

    table_open(&t, "oracle/stereo.tsv");
    assert_true(table_next(&t));
    while (table_next(&t)) {
        bool same;

        if (is_contradictory(&t))
            continue;
        same = strcmp(canonical(f, t.field[2]), canonical(f, t.field[3])) == 0;
        if (same != (strcmp(t.field[4], "same") == 0))
            fail_msg("%s: %s %s", t.field[0], t.field[2], t.field[3]);
        lines++;
    }
    assert_int_equal(lines, 149);
}

/* Spellings of one molecule; the equalities follow from the OpenSMILES text, worked out by hand. */
static void canonical__is_equal_for_equals(void **state)
{
    static const char *const pairs[][2] = {
        {"CN(=O)=O", "C[N+](=O)[O-]"},
        {"O=n1ccccc1", "[O-][n+]1ccccc1"},
        {"CN=N#N", "CN=[N+]=[N-]"},
        {"C=N#N", "C=[N+]=[N-]"},
        {"c1ccccc1-c1ccccc1", "c1ccccc1c1ccccc1"},
        {"C1=CC=CC2=CC=CC=C12", "c1ccc2ccccc2c1"},
        {"C[C@H]([2H])O", "[2H][C@@H](C)O"},
        {"[H]/N=C/C", "C\\C=N\\[H]"},
        {"[CH3:7][OH:1]", "CO"},
        {"C[CH2:1][H:2]", "CC"},
        {"[Cl-].[Na+]", "[Na+].[Cl-]"},
        {"C1=CC=CC=C1C", "Cc1ccccc1"},
        {"CC1=C(C)C=CC=C1", "CC1=CC=CC=C1C"},
        {"F/C=C/C=C/Cl", "Cl/C=C/C=C/F"},
        {"F/C=C/C=CC=CCl", "F/C=C/C=CC=CCl"},
    };
    fixture *f = *state;

    for (size_t i = 0; i < sizeof pairs / sizeof pairs[0]; i++)
        assert_string_equal(canonical(f, pairs[i][0]), canonical(f, pairs[i][1]));
    assert_string_not_equal(canonical(f, "[H]/N=C/C"), canonical(f, "[H]/N=C\\C"));
    assert_string_not_equal(canonical(f, "[H]/N=C/C"), canonical(f, "N=CC"));
}

/* Strings that were none once; damaged ones, found by chance. */
static void canonical__is_a_fixed_point(void **state)
{
    static const char *const texts[] = {
        "[H]**C1=*=***=CC2=C1C2=C/C=C*",
        "N(Br)=[C@]=C(O)C",
        "Br\\C\\C(\\I)=C(\\I)=C(\\Cl)/F",
        "C1=CC=C2N=C3C1=CC1=C=CC1=C1CCC=C3CC2=C1",
        "N1=SCN1=CSC2=C1C3=C(N1=CS3)N=N2",
        "C*1(=O)2=C(C3=C(C=N2)C=CC=C3)CCCN1C",
        "[H]:C",
    };
    fixture *f = *state;

    for (size_t i = 0; i < sizeof texts / sizeof texts[0]; i++) {
        char *text = canonical(f, texts[i]);

        assert_string_equal(canonical(f, text), text);
        assert_string_equal(canonical(f, plain(f, texts[i])), text);
    }
}

/*
 * The middle double bond has no geometry, and none may be lent to it by the slants of the outer
 * ones.
 */
static void written__leaves_unmarked_double_bonds_alone(void **state)
{
    static const char *const texts[] = {
        "F/C(Cl)=C(/[H])C=CC(/[H])=C(F)Cl",
        "C/C(Cl)=C(/Br)C=CC(/Br)=C(/C)Cl",
        "F/C(Cl)=C([H])/C(C)=C(Br)C(\\[H])=C(/F)Cl",
    };
    fixture *f = *state;

    for (size_t i = 0; i < sizeof texts / sizeof texts[0]; i++) {
        char *text = canonical(f, texts[i]);
        bs_mol *mol = read_mol(f, texts[i]);
        bs_mol *again = read_mol(f, text);
        int marks = 0;

        for (int b = 0; b < bs_mol_bond_count(mol); b++) {
            marks += bs_mol_bond_geometry(mol, b) != BS_GEOMETRY_NONE;
            marks -= bs_mol_bond_geometry(again, b) != BS_GEOMETRY_NONE;
        }
        assert_int_equal(marks, 0);
        assert_string_equal(canonical(f, text), text);
    }
}

static void written__puts_brackets_only_where_needed(void **state)
{
    static const char *const texts[] = {
        "C",         "[CH3]",
        "[NH4+]",    "c1cc[nH]c1",
        "[2H]C",     "[Fe+2]",
        "Cl",        "[Cl-]",
        "*",         "[13CH4]",
        "c1ccsc1",   "[O-][n+]1ccccc1",
        "[H][H]",    "[H+]",
        "CS(=O)C",   "FS(F)(F)F",
        "C[S+](C)C", "c1cc[se]c1",
        "B1C=CC=C1", "[CH2]",
        "O=[N+]",    "[U]",
        "*c1ccccc1", "CC(=O)[O-]",
        "[BH4-]",    "c1ccccc1-c1ccccc1",
    };
    fixture *f = *state;

    for (size_t i = 0; i < sizeof texts / sizeof texts[0]; i++)
        assert_string_equal(plain(f, texts[i]), texts[i]);
}

static void written__labels_and_stereo_are_a_choice(void **state)
{
    fixture *f = *state;
    bs_mol *mol = read_mol(f, "[CH3:5]/C=C/[C@H](F)Cl");
    char *out;

    check_ok(f, bs_smiles_write(&f->cx, &f->home, mol, 0, &out));
    assert_string_equal(out, "C/C=C/[C@H](F)Cl");
    check_ok(f,
             bs_smiles_write(&f->cx, &f->home, mol, BS_SMILES_LABELS | BS_SMILES_NO_STEREO, &out));
    assert_string_equal(out, "[CH3:5]C=CC(F)Cl");
    check_ok(f, bs_smiles_canonical(&f->cx, &f->home, mol, BS_SMILES_NO_STEREO, &out));
    assert_string_equal(out, canonical(f, "CC=CC(F)Cl"));
}

static void canonical__order_and_places_lead_to_the_atoms(void **state)
{
    fixture *f = *state;
    bs_mol *mol = read_mol(f, "[Na+].[O-]c1ccc(Br)cc1.Cl");
    uint32_t *order;
    uint32_t *at;
    char *out;
    unsigned seen = 0;

    check_ok(f, bs_smiles_canonical_order(&f->cx, &f->home, mol, 0, &out, &order, &at));
    for (int k = 0; k < bs_mol_atom_count(mol); k++) {
        const char *symbol = bs_element_symbol(bs_mol_atom_element(mol, (int)order[k]));
        const char *text = out + at[k] + (out[at[k]] == '[');

        assert_int_equal(text[0] & ~32, symbol[0]);
        seen |= 1u << order[k];
    }
    assert_int_equal(seen, (1u << bs_mol_atom_count(mol)) - 1);
    mol = read_mol(f, "[H:3][NH:1]C");
    check_ok(f, bs_smiles_canonical_order(&f->cx, &f->home, mol, 0, &out, &order, &at));
    assert_string_equal(out, "CN");
    assert_int_equal(order[0], 2);
    assert_int_equal(order[1], 1);
    assert_int_equal(order[2], 0);
    assert_int_equal(at[2], at[1]);
}

static void written__every_failed_allocation_is_rolled_back(void **state)
{
    fixture *f = *state;
    const char *text = "C[C@H](F)/C=C/c1ccc2ccccc2c1.[Na+]";
    bool done = false;

    for (long n = 0; !done; n++) {
        size_t live = f->home.live;
        bs_mol *mol = NULL;
        char *out = NULL;
        bs_status st;

        atomic_store(&f->cx.own_gate.fail_after, n);
        st = bs_smiles_read(&f->cx, &f->home, text, strlen(text), NULL, &mol);
        if (st == BS_OK)
            st = bs_smiles_canonical(&f->cx, &f->home, mol, 0, &out);
        atomic_store(&f->cx.own_gate.fail_after, -1);
        done = st == BS_OK;
        if (!done) {
            assert_int_equal(st, BS_ENOMEM);
            assert_null(out);
            if (!mol)
                assert_int_equal(f->home.live, live);
        }
        assert_int_equal(f->cx.scratch.live, 0);
    }
}

int main(void)
{
    const struct CMUnitTest tests[] = {
        check_case(written__reads_back_as_the_same_molecule),
        check_case(canonical__does_not_depend_on_the_spelling),
        check_case(canonical__tells_stereoisomers_apart),
        check_case(canonical__is_equal_for_equals),
        check_case(canonical__is_a_fixed_point),
        check_case(written__leaves_unmarked_double_bonds_alone),
        check_case(written__puts_brackets_only_where_needed),
        check_case(written__labels_and_stereo_are_a_choice),
        check_case(canonical__order_and_places_lead_to_the_atoms),
        check_case(written__every_failed_allocation_is_rolled_back),
    };

    return cmocka_run_group_tests(tests, NULL, NULL);
}
