/* Opening what may be no catalogue, and the demo catalogue as a whole. */
#include "catalogue/folder.h"

#include "backsaw/catalogue.h"
#include "backsaw/format.h"

#include <sqlite3.h>

static void check_refused(folder *d, const char *path, const char *message)
{
    bs_catalogue *catalogue = (bs_catalogue *)d;

    assert_int_equal(bs_catalogue_open(&d->f->cx, path, &catalogue), BS_EFILE);
    assert_null(catalogue);
    if (!strstr(d->f->cx.error.message, message))
        fail_msg("the message is: %s", d->f->cx.error.message);
}

/* Builds a small catalogue and runs SQL on it, as a stranger might. */
static const char *tampered(folder *d, const char *sql)
{
    const char *input = folder_puts(d, "a.smi", "CCO ethanol\nCO methanol\n");
    const char *output = folder_name(d, "out.catalogue");
    bs_import_report report;
    sqlite3 *db;

    check_ok(d->f, bs_catalogue_build(&d->f->cx, &input, 1, output, &report));
    assert_int_equal(sqlite3_open(output, &db), SQLITE_OK);
    if (sqlite3_exec(db, sql, NULL, NULL, NULL) != SQLITE_OK)
        fail_msg("%s: %s", sql, sqlite3_errmsg(db));
    sqlite3_close(db);
    return output;
}

static void open__what_is_no_catalogue(void **state)
{
    folder *d = *state;

    check_refused(d, folder_name(d, "nothing"), "No such file");
    check_refused(d, d->path, "not a regular file");
    check_refused(d, folder_puts(d, "text", "CCO ethanol\n"), "is no catalogue");
    check_refused(d, folder_puts(d, "empty", ""), "is no catalogue");
    check_refused(d, ":memory:", "No such file");
    check_refused(d, "", "No such file");
    check_refused(d, tampered(d, "PRAGMA application_id = 0"), "is no catalogue");
}

static void open__other_versions_say_so(void **state)
{
    folder *d = *state;

    check_refused(d, tampered(d, "PRAGMA user_version = 999"), "has format 999");
    check_refused(d, tampered(d, "UPDATE offer SET smiles = 'OCC' WHERE smiles = 'CCO'"),
                  "build it again");
}

static void open__strange_tables_are_refused(void **state)
{
    folder *d = *state;

    check_refused(d, tampered(d, "DROP TABLE offer"), "damaged");
    check_refused(d, tampered(d, "CREATE TABLE more (x)"), "damaged");
    check_refused(d,
                  tampered(d, "ALTER TABLE offer RENAME TO kept; CREATE VIEW offer AS SELECT * "
                              "FROM kept"),
                  "damaged");
    check_refused(d, tampered(d, "CREATE TRIGGER t AFTER INSERT ON offer BEGIN SELECT 1; END"),
                  "damaged");
}

/* Every byte of a small catalogue spoilt in turn: an error or an answer, never worse. */
static void open__spoilt_bytes_do_no_harm(void **state)
{
    folder *d = *state;
    const char *path = tampered(d, "SELECT 1");
    size_t length;
    char *bytes = folder_slurp(path, &length);
    bs_mol *mol;
    FILE *file;

    check_ok(d->f, bs_smiles_read(&d->f->cx, &d->f->home, "CCO", 3, NULL, &mol));
    for (size_t i = 0; i < length; i += i < 200 ? 1 : 37) {
        bs_catalogue *catalogue;
        bs_offers offers;

        file = fopen(path, "wb");
        assert_non_null(file);
        bytes[i] = (char)~bytes[i];
        assert_int_equal(fwrite(bytes, 1, length, file), length);
        fclose(file);
        bytes[i] = (char)~bytes[i];
        if (bs_catalogue_open(&d->f->cx, path, &catalogue) != BS_OK)
            continue;
        bs_catalogue_find(&d->f->cx, &d->f->home, catalogue, mol, &offers);
        bs_catalogue_close(catalogue);
    }
    free(bytes);
}

static void open__names_that_mean_more_to_sqlite(void **state)
{
    folder *d = *state;
    const char *input = folder_puts(d, "a.smi", "CCO\n");
    bs_import_report report;
    bs_catalogue *catalogue;

    assert_int_equal(chdir(d->path), 0);
    check_ok(d->f, bs_catalogue_build(&d->f->cx, &input, 1, "file:x?mode=memory", &report));
    assert_int_equal(folder_count(d), 2);
    check_ok(d->f, bs_catalogue_open(&d->f->cx, "file:x?mode=memory", &catalogue));
    assert_int_equal(bs_catalogue_count(catalogue), 1);
    bs_catalogue_close(catalogue);
    assert_int_equal(chdir("/"), 0);
}

/* The next tab-separated field, cut off. */
static char *next_field(char **rest)
{
    char *field = *rest, *end = strpbrk(field, "\t\n");

    assert_non_null(end);
    *end = '\0';
    *rest = end + 1;
    return field;
}

/* Looks one line of the demo list up again; every offer of it must be that line's. */
static void check_line(folder *d, bs_catalogue *catalogue, char *line)
{
    bs_mark kept = bs_arena_mark(&d->f->home);
    char *code = next_field(&line), *name = next_field(&line), *smiles = next_field(&line);
    double price = strtod(next_field(&line), NULL);
    bs_mol *mol;
    bs_offers offers;

    check_ok(d->f, bs_smiles_read(&d->f->cx, &d->f->home, smiles, strlen(smiles), NULL, &mol));
    check_ok(d->f, bs_catalogue_find(&d->f->cx, &d->f->home, catalogue, mol, &offers));
    if (offers.count != 1)
        fail_msg("%s (%s) has %d offers, not one", code, smiles, offers.count);
    assert_string_equal(offers.items[0].code, code);
    assert_string_equal(offers.items[0].name, name);
    assert_true(offers.items[0].price_per_gram == price);
    bs_arena_rewind(&d->f->home, kept);
}

static void demo__all_lines_are_read_and_found(void **state)
{
    folder *d = *state;
    const char *input = BACKSAW_SOURCE_DIR "/examples/demo-catalogue.tsv";
    const char *output = folder_name(d, "demo.catalogue");
    bs_import_report report;
    bs_catalogue *catalogue;
    char line[2000];
    FILE *file = fopen(input, "r");
    int lines = 0;

    check_ok(d->f, bs_catalogue_build(&d->f->cx, &input, 1, output, &report));
    if (report.refused > 0)
        fail_msg("%ld refused: %s", report.refused, report.first_refused);
    assert_int_equal(report.offers, 5583);
    check_ok(d->f, bs_catalogue_open(&d->f->cx, output, &catalogue));
    assert_int_equal(bs_catalogue_count(catalogue), 5583);
    assert_non_null(file);
    assert_non_null(fgets(line, sizeof line, file));
    for (; fgets(line, sizeof line, file); lines++)
        check_line(d, catalogue, line);
    assert_int_equal(lines, 5583);
    fclose(file);
    bs_catalogue_close(catalogue);
}

int main(void)
{
    const struct CMUnitTest tests[] = {
        folder_case(open__what_is_no_catalogue),
        folder_case(open__other_versions_say_so),
        folder_case(open__strange_tables_are_refused),
        folder_case(open__spoilt_bytes_do_no_harm),
        folder_case(open__names_that_mean_more_to_sqlite),
        folder_case(demo__all_lines_are_read_and_found),
    };

    return cmocka_run_group_tests(tests, NULL, NULL);
}
