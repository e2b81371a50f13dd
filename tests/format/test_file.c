/* Files of molecules: SD files and lists of SMILES, streamed. */
#include "support/molecule.h"
#include "support/scratch.h"

#include "backsaw/file.h"

#define SDF "test_format_file.sdf"
#define SDF_GZ "test_format_file.sdf.gz"
#define SMI "test_format_file.smi"
#define SMI_GZ "test_format_file.SMI.GZ"

#define WATER                                                                                      \
    "water\n\n\n  1  0  0  0  0  0  0  0  0  0999 V2000\n"                                         \
    "    0.0000    0.0000    0.0000 O   0  0\nM  END\n"
#define BAD                                                                                        \
    "bad\n\n\n  1  0  0  0  0  0  0  0  0  0999 V2000\n"                                           \
    "    0.0000    0.0000    0.0000 Xx  0  0\nM  END\n"

static bs_file *open_text(fixture *f, const char *name, const char *text, size_t length)
{
    bs_file *file;

    scratch_write(name, text, length);
    check_ok(f, bs_file_open(&f->cx, name, NULL, &file));
    return file;
}

static const bs_record *next(fixture *f, bs_file *file)
{
    bs_record *record;

    check_ok(f, bs_file_next(file, &f->home, &record));
    return record;
}

static void check_text(const char *text, size_t length, const char *expected)
{
    assert_int_equal(length, strlen(expected));
    assert_string_equal(text, expected);
}

/* ---- SD files ------------------------------------------------------------------------------ */

static void sdf__names_and_fields(void **state)
{
    fixture *f = *state;
    static const char text[] =
        WATER "> <boiling point> (ID)\n100 \xC2\xB0"
              "C\n\n>  25 <NOTE>\nfirst\r\n\nthird\n\n> DT12\n\n>  <empty>\n\n"
              "$$$$\n" WATER;
    bs_file *file = open_text(f, SDF, text, sizeof text - 1);
    const bs_record *record = next(f, file);

    check_molecule(f, record->mol, "O");
    check_text(record->name, record->name_length, "water");
    assert_int_equal(record->number, 1);
    assert_int_equal(record->field_count, 4);
    check_text(record->fields[0].name, record->fields[0].name_length, "boiling point");
    check_text(record->fields[0].value, record->fields[0].value_length,
               "100 \xC2\xB0"
               "C");
    check_text(record->fields[1].name, record->fields[1].name_length, "NOTE");
    check_text(record->fields[1].value, record->fields[1].value_length, "first\n\nthird");
    check_text(record->fields[2].name, record->fields[2].name_length, "DT12");
    check_text(record->fields[2].value, record->fields[2].value_length, "");
    check_text(record->fields[3].name, record->fields[3].name_length, "empty");
    record = next(f, file);
    assert_int_equal(record->number, 2);
    assert_int_equal(record->line, 20);
    assert_int_equal(record->field_count, 0);
    assert_null(next(f, file));
    assert_null(next(f, file));
    bs_file_close(file);
}

static void sdf__bad_record_is_reported_and_passed_over(void **state)
{
    fixture *f = *state;
    static const char text[] = WATER "$$$$\n" BAD "$$$$\n" WATER "$$$$\n\n\n";
    bs_file *file = open_text(f, SDF, text, sizeof text - 1);
    bs_record *record;

    assert_non_null(next(f, file));
    assert_int_equal(bs_file_next(file, &f->home, &record), BS_EVALUE);
    assert_null(record);
    assert_string_equal(f->cx.error.message, "line 12, columns 32 to 34: 'Xx' is no element; a "
                                             "symbol such as C or Cl was expected");
    assert_int_equal(f->cx.error.line, 12);
    assert_true(bs_file_can_go_on(file));
    assert_int_equal(bs_file_record_number(file), 2);
    assert_int_equal(bs_file_record_line(file), 8);
    assert_int_equal(next(f, file)->number, 3);
    assert_null(next(f, file));
    bs_file_close(file);
}

static void sdf__text_in_latin_1_becomes_utf_8(void **state)
{
    fixture *f = *state;
    static const char text[] = "na\xEFve\n\n\n  0  0  0  0  0  0  0  0  0  0999 V2000\nM  END\n"
                               "> <t>\n100 \xB0"
                               "C\0!\n\n$$$$\n";
    bs_file *file = open_text(f, SDF, text, sizeof text - 1);
    const bs_record *record = next(f, file);

    check_text(record->name, record->name_length, "na\xC3\xAFve");
    assert_int_equal(record->fields[0].value_length, 9);
    assert_memory_equal(record->fields[0].value,
                        "100 \xC2\xB0"
                        "C\0!",
                        10);
    bs_file_close(file);
}

static void sdf__stray_text_is_refused(void **state)
{
    fixture *f = *state;
    static const char text[] = WATER "what is this?\n$$$$\n" WATER;
    bs_file *file = open_text(f, SDF, text, sizeof text - 1);
    bs_record *record;

    assert_int_equal(bs_file_next(file, &f->home, &record), BS_ESYNTAX);
    assert_string_equal(f->cx.error.message,
                        "line 7: a data field such as > <NAME> or $$$$ was expected");
    assert_non_null(next(f, file));
    assert_null(next(f, file));
    bs_file_close(file);
}

/* 10,000 records in a gzip file; memory stays as it is after the first. */
static void sdf__streams_in_constant_memory(void **state)
{
    fixture *f = *state;
    static const char text[] = WATER "> <n>\n1\n\n$$$$\n";
    long count = 0;
    size_t used = 0;
    bs_file *file;

    scratch_write_gzip(SDF_GZ, text, sizeof text - 1, 10000);
    check_ok(f, bs_file_open(&f->cx, SDF_GZ, NULL, &file));
    for (;;) {
        bs_mark kept = bs_arena_mark(&f->home);
        const bs_record *record = next(f, file);

        if (!record)
            break;
        count++;
        assert_int_equal(record->number, count);
        if (count == 1)
            used = atomic_load(&f->cx.own_gate.used);
        assert_true(atomic_load(&f->cx.own_gate.used) <= used);
        bs_arena_rewind(&f->home, kept);
    }
    assert_int_equal(count, 10000);
    bs_file_close(file);
}

/* A line of 100 MB within a record, and a record of 100 MB of short lines: refused, passed over. */
static void sdf__lines_and_records_that_are_too_long_are_passed_over(void **state)
{
    fixture *f = *state;
    static char block[1 << 20];
    FILE *out = fopen(SDF, "wb");
    bs_file *file;
    bs_record *record;

    assert_non_null(out);
    fputs(WATER "> <long>\n", out);
    memset(block, 'x', sizeof block);
    for (int i = 0; i < 100; i++)
        fwrite(block, 1, sizeof block, out);
    fputs("\n\n$$$$\n" WATER "> <long>\n", out);
    for (size_t i = 79; i < sizeof block; i += 80)
        block[i] = '\n';
    for (int i = 0; i < 100; i++)
        fwrite(block, 1, sizeof block, out);
    fputs("\n$$$$\n" WATER, out);
    fclose(out);
    check_ok(f, bs_file_open(&f->cx, SDF, NULL, &file));
    assert_int_equal(bs_file_next(file, &f->home, &record), BS_ELIMIT);
    assert_string_equal(f->cx.error.message, "line 8 is longer than 1048576 bytes");
    assert_true(bs_file_can_go_on(file));
    assert_int_equal(bs_file_next(file, &f->home, &record), BS_ELIMIT);
    assert_non_null(strstr(f->cx.error.message, "the record is longer than 67108864 bytes"));
    assert_true(bs_file_can_go_on(file));
    assert_int_equal(next(f, file)->number, 3);
    assert_null(next(f, file));
    bs_file_close(file);
    remove(SDF);
}

/* 200 MB of blank lines in a gzip file of 200 KB. */
static void sdf__gzip_bomb_is_refused(void **state)
{
    fixture *f = *state;
    static char block[1 << 20];
    bs_file *file;
    bs_record *record;

    memset(block, '\n', sizeof block);
    scratch_write_gzip(SDF_GZ, block, sizeof block, 200);
    check_ok(f, bs_file_open(&f->cx, SDF_GZ, NULL, &file));
    assert_int_equal(bs_file_next(file, &f->home, &record), BS_ELIMIT);
    if (bs_file_can_go_on(file))
        assert_int_equal(bs_file_next(file, &f->home, &record), BS_ELIMIT);
    assert_false(bs_file_can_go_on(file));
    bs_file_close(file);
}

static void sdf__stop_flag_ends_the_reading(void **state)
{
    fixture *f = *state;
    static char block[1 << 20];
    bs_file *file;
    bs_record *record;

    memset(block, 'x', sizeof block);
    file = open_text(f, SDF, block, sizeof block);
    atomic_store(&f->cx.own_stop, true);
    assert_int_equal(bs_file_next(file, &f->home, &record), BS_ESTOPPED);
    atomic_store(&f->cx.own_stop, false);
    assert_false(bs_file_can_go_on(file));
    bs_file_close(file);
}

static void sdf__gives_everything_back_when_memory_runs_out(void **state)
{
    fixture *f = *state;
    static const char text[] = WATER "> <n>\n1\n\n$$$$\n";
    bs_status st = BS_ENOMEM;

    scratch_write(SDF, text, sizeof text - 1);
    for (long allowed = 0; st == BS_ENOMEM && allowed < 1000; allowed++) {
        bs_file *file = NULL;
        bs_record *record;
        size_t live = f->home.live;

        atomic_store(&f->cx.own_gate.fail_after, allowed);
        st = bs_file_open(&f->cx, SDF, NULL, &file);
        if (st == BS_OK)
            st = bs_file_next(file, &f->home, &record);
        atomic_store(&f->cx.own_gate.fail_after, -1);
        bs_file_close(file);
        if (st != BS_OK)
            assert_int_equal(f->home.live, live);
    }
    assert_int_equal(st, BS_OK);
}

/* What is written comes back: name, fields with blank lines and marks, molecule. */
static void sdf__written_records_come_back(void **state)
{
    fixture *f = *state;
    bs_field fields[] = {{"a<b>", 4, "1\n\n$$$$\n> <x>", 13}, {"empty", 5, "", 0}};
    bs_record record = {.mol = molecule_read(f, "C[C@H](N)C(=O)O"),
                        .name = "$alanine",
                        .name_length = 8,
                        .fields = fields,
                        .field_count = 2};
    const bs_record *again;
    bs_text text;
    bs_file *file;

    bs_text_init(&text, &f->cx);
    check_ok(f, bs_sdf_write(&text, &record, BS_MOLFILE_AUTO, NULL));
    check_ok(f, bs_sdf_write(&text, &record, BS_MOLFILE_V3000, NULL));
    file = open_text(f, SDF, text.data, text.length);
    bs_text_free(&text);
    for (int i = 0; i < 2; i++) {
        again = next(f, file);
        check_molecule(f, again->mol, "C[C@H](N)C(=O)O");
        check_text(again->name, again->name_length, "$alanine");
        assert_int_equal(again->field_count, 2);
        check_text(again->fields[0].name, again->fields[0].name_length, "a[b]");
        check_text(again->fields[0].value, again->fields[0].value_length, "1\n \n $$$$\n > <x>");
        check_text(again->fields[1].value, again->fields[1].value_length, "");
    }
    assert_null(next(f, file));
    bs_file_close(file);
}

/* A racemic pair of centres and a relative one are kept, which takes V3000. */
static void sdf__written_stereo_groups_come_back(void **state)
{
    fixture *f = *state;
    int pair[] = {1, 3};
    int one[] = {5};
    bs_stereo_group groups[] = {{BS_STEREO_GROUP_RACEMIC, 1, 2, pair},
                                {BS_STEREO_GROUP_RELATIVE, 3, 1, one}};
    bs_record record = {.mol = molecule_read(f, "C[C@H](F)[C@H](Cl)C[C@H](Br)C"),
                        .groups = groups,
                        .group_count = 2};
    const bs_record *again;
    bs_text text;
    bs_file *file;

    bs_text_init(&text, &f->cx);
    assert_int_equal(bs_sdf_write(&text, &record, BS_MOLFILE_V2000, NULL), BS_EVALUE);
    assert_string_equal(f->cx.error.message,
                        "V2000 cannot hold relative and racemic centres; V3000 can");
    check_ok(f, bs_sdf_write(&text, &record, BS_MOLFILE_AUTO, NULL));
    file = open_text(f, SDF, text.data, text.length);
    bs_text_free(&text);
    again = next(f, file);
    assert_int_equal(again->group_count, 2);
    for (int i = 0; i < 2; i++) {
        assert_int_equal(again->groups[i].kind, groups[i].kind);
        assert_int_equal(again->groups[i].number, groups[i].number);
        assert_int_equal(again->groups[i].atom_count, groups[i].atom_count);
        assert_memory_equal(again->groups[i].atoms, groups[i].atoms,
                            (size_t)groups[i].atom_count * sizeof(int));
    }
    bs_file_close(file);
}

/* ---- SMILES -------------------------------------------------------------------------------- */

static void smiles__with_names_comments_and_a_heading(void **state)
{
    fixture *f = *state;
    static const char text[] = "SMILES name\n# a comment\n\nCCO\tethyl  alcohol \nO\n"
                               "  CC |$a;b$| ethane\r\n";
    bs_file *file = open_text(f, SMI, text, sizeof text - 1);
    const bs_record *record = next(f, file);

    check_molecule(f, record->mol, "OCC");
    check_text(record->name, record->name_length, "ethyl  alcohol");
    assert_int_equal(record->line, 4);
    record = next(f, file);
    check_molecule(f, record->mol, "O");
    check_text(record->name, record->name_length, "");
    record = next(f, file);
    check_text(record->name, record->name_length, "ethane");
    assert_int_equal(record->number, 3);
    assert_null(next(f, file));
    bs_file_close(file);
}

static void smiles__bad_line_is_reported_and_passed_over(void **state)
{
    fixture *f = *state;
    bs_file *file = open_text(f, SMI, "C\n  CC(C\nN\n", 11);
    bs_record *record;

    assert_non_null(next(f, file));
    assert_int_equal(bs_file_next(file, &f->home, &record), BS_ESYNTAX);
    assert_int_equal(f->cx.error.line, 2);
    assert_memory_equal(f->cx.error.message, "line 2, column 5: ", 18);
    assert_true(bs_file_can_go_on(file));
    check_molecule(f, next(f, file)->mol, "N");
    assert_null(next(f, file));
    bs_file_close(file);
}

static void file__kind_follows_the_name(void **state)
{
    fixture *f = *state;
    bs_file_options options = {.kind = BS_FILE_SMILES};
    bs_file *file;

    scratch_write_gzip(SMI_GZ, "C\n", 2, 1);
    check_ok(f, bs_file_open(&f->cx, SMI_GZ, NULL, &file));
    check_molecule(f, next(f, file)->mol, "C");
    bs_file_close(file);
    assert_int_equal(bs_file_open(&f->cx, "molecules.xyz", NULL, &file), BS_EVALUE);
    assert_null(file);
    assert_string_equal(f->cx.error.message,
                        "the name 'molecules.xyz' does not tell what is in the file; .sdf, .mol or "
                        ".smi was expected, or one of them with .gz");
    scratch_write(SDF, "N\n", 2);
    check_ok(f, bs_file_open(&f->cx, SDF, &options, &file));
    check_molecule(f, next(f, file)->mol, "N");
    bs_file_close(file);
    assert_int_equal(bs_file_open(&f->cx, "none.sdf", NULL, &file), BS_EFILE);
}

static int remove_files(void **state)
{
    (void)state;
    remove(SDF);
    remove(SDF_GZ);
    remove(SMI);
    remove(SMI_GZ);
    return 0;
}

int main(void)
{
    const struct CMUnitTest tests[] = {
        check_case(sdf__names_and_fields),
        check_case(sdf__bad_record_is_reported_and_passed_over),
        check_case(sdf__text_in_latin_1_becomes_utf_8),
        check_case(sdf__stray_text_is_refused),
        check_case(sdf__streams_in_constant_memory),
        check_case(sdf__lines_and_records_that_are_too_long_are_passed_over),
        check_case(sdf__gzip_bomb_is_refused),
        check_case(sdf__stop_flag_ends_the_reading),
        check_case(sdf__gives_everything_back_when_memory_runs_out),
        check_case(sdf__written_records_come_back),
        check_case(sdf__written_stereo_groups_come_back),
        check_case(smiles__with_names_comments_and_a_heading),
        check_case(smiles__bad_line_is_reported_and_passed_over),
        check_case(file__kind_follows_the_name),
    };

    return cmocka_run_group_tests_name("format.file", tests, NULL, remove_files);
}
