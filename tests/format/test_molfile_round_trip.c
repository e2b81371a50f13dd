/*
 * The 5,000 molecules of tests/data/oracle drawn, written as molfiles and read again: the same
 * canonical SMILES. Under the sanitizers only every fifteenth, since drawing is slow there.
 */
#include "support/molecule.h"
#include "support/table.h"

#include "backsaw/file.h"

#ifdef BS_ARENA_DEBUG
enum { EVERY = 15 };
#else
enum { EVERY = 1 };
#endif

static void check_round_trip(fixture *f, const bs_mol *mol, bs_molfile_version version,
                             const char *id)
{
    bs_text text;
    bs_record *record;
    int lost = 0;

    bs_text_init(&text, &f->cx);
    check_ok(f, bs_molfile_write(&text, mol, id, version, &lost));
    check_ok(f, bs_molfile_read(&f->cx, &f->home, text.data, text.length, &record));
    if (lost != 0 || strcmp(molecule_text(f, mol), molecule_text(f, record->mol)) != 0)
        fail_msg("%s: %s became %s, %d stereo elements lost", id, molecule_text(f, mol),
                 molecule_text(f, record->mol), lost);
    assert_string_equal(record->name, id);
    bs_text_free(&text);
}

static void check_all(fixture *f, bs_molfile_version version)
{
    static table t;
    long number = 0;

    table_open(&t, "oracle/molecules.smi.gz");
    while (table_next(&t)) {
        bs_mark kept = bs_arena_mark(&f->home);

        if (number++ % EVERY == 0)
            check_round_trip(f, molecule_read(f, t.field[0]), version, t.field[1]);
        bs_arena_rewind(&f->home, kept);
    }
    assert_int_equal(number, 5000);
}

static void round_trip__in_v2000(void **state)
{
    check_all(*state, BS_MOLFILE_V2000);
}

static void round_trip__in_v3000(void **state)
{
    check_all(*state, BS_MOLFILE_V3000);
}

/* What the set has little of. */
static void round_trip__of_rare_things(void **state)
{
    fixture *f = *state;
    static const char *const smiles[] = {
        "[CH3]",
        "[CH2]",
        "C[N]C",
        "CC(C)(C)N([O])C",
        "[O][O]",
        "[Na]",
        "[Al](C)(C)C",
        "[SiH3][SiH3]",
        "Cl[I](Cl)c1ccccc1",
        "CS(C)(=O)=O",
        "C[S@](=O)CC",
        "C[P@@](=O)(CC)c1ccccc1",
        "C[S@@+](CC)F",
        "F/C(Cl)=C(/F)Cl",
        "CC=[C@]=CC",
        "CC(F)=[C@@]=C(C)F",
        "C/C=C=C=C/C",
        "[*:1]C[*:2]",
        "[12*]C",
        "[CH3:5][OH:999]",
        "[2H]OC",
        "[H][H]",
        "[H+]",
        "CC/C(C)=N/[H]",
        "C/C=N/O",
        "N#[N+][O-]",
        "[Fe+2].[Cl-].[Cl-]",
        "OB(O)c1ccccc1",
        "[BH4-].[Na+]",
        "F[P-](F)(F)(F)(F)F",
        "C1=CC=CC=CC=C1",
        "O[C@H]1CC[C@@H](C)CC1",
        "C[C@H]1[C@@H](C)[C@H]1C",
        "[U]",
        "F[Xe]F",
        "*",
        "[Cu]",
        "c1cc[nH]c1",
        "C[C@@H]1CC[C@]2(C1)CCC2=C",
        "C[Si@](F)(Cl)CC",
        "C[N@+](CC)(CCC)c1ccccc1",
        "C[C@@H]1CN1C",
    };

    for (size_t i = 0; i < sizeof smiles / sizeof *smiles; i++) {
        const bs_mol *mol = molecule_read(f, smiles[i]);

        check_round_trip(f, mol, BS_MOLFILE_V2000, smiles[i]);
        check_round_trip(f, mol, BS_MOLFILE_V3000, smiles[i]);
    }
}

/* A chain of 1,200 atoms with 300 centres and 100 double bonds, as V3000 and plain drawing. */
static void round_trip__of_a_large_molecule(void **state)
{
    fixture *f = *state;
    bs_text text;

    bs_text_init(&text, &f->cx);
    check_ok(f, bs_text_puts(&text, "F"));
    for (int i = 0; i < 100; i++)
        check_ok(f, bs_text_puts(&text, i % 2 ? "C[C@H](O)[C@@H](C)[C@H](N)/C=C/C1CC1C"
                                              : "C[C@@H](O)[C@@H](C)[C@H](Cl)/C=C\\Cc1ccccc1"));
    check_round_trip(f, molecule_read(f, text.data), BS_MOLFILE_AUTO, "large");
    bs_text_free(&text);
}

int main(void)
{
    const struct CMUnitTest tests[] = {
        check_case(round_trip__in_v2000),
        check_case(round_trip__in_v3000),
        check_case(round_trip__of_rare_things),
        check_case(round_trip__of_a_large_molecule),
    };

    return cmocka_run_group_tests_name("format.molfile_round_trip", tests, NULL, NULL);
}
