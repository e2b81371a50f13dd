/* Catalogues built from lists, and what happens to the file when that fails. */
#include "catalogue/folder.h"

#include "backsaw/catalogue.h"
#include "backsaw/format.h"

static const bs_mol *read_mol(folder *d, const char *smiles)
{
    bs_mol *mol;

    check_ok(d->f, bs_smiles_read(&d->f->cx, &d->f->home, smiles, strlen(smiles), NULL, &mol));
    return mol;
}

static bs_status build(folder *d, const char *input, const char *output, bs_import_report *report)
{
    return bs_catalogue_build(&d->f->cx, &input, 1, output, report);
}

/* Builds a catalogue from one list and opens it. */
static bs_catalogue *build_and_open(folder *d, const char *file, const char *text,
                                    bs_import_report *report)
{
    const char *input = folder_puts(d, file, text), *output = folder_name(d, "out.catalogue");
    bs_catalogue *catalogue;

    check_ok(d->f, build(d, input, output, report));
    check_ok(d->f, bs_catalogue_open(&d->f->cx, output, &catalogue));
    return catalogue;
}

static bs_offers find(folder *d, bs_catalogue *catalogue, const char *smiles)
{
    bs_offers offers;

    check_ok(d->f, bs_catalogue_find(&d->f->cx, &d->f->home, catalogue, read_mol(d, smiles),
                                     &offers));
    return offers;
}

/* ---- What gets in ---------------------------------------------------------------------- */

static void check_format(folder *d, const char *file, const char *text, bool priced)
{
    bs_import_report report;
    bs_catalogue *catalogue = build_and_open(d, file, text, &report);
    bs_offers offers = find(d, catalogue, "OCC");

    assert_int_equal(report.lines, 2);
    assert_int_equal(report.offers, 2);
    assert_int_equal(report.refused, 0);
    assert_int_equal(bs_catalogue_count(catalogue), 2);
    assert_int_equal(offers.count, 1);
    assert_string_equal(offers.items[0].name, "ethanol, absolute");
    assert_string_equal(offers.items[0].ground, "identity");
    if (priced) {
        assert_string_equal(offers.items[0].code, "E-1");
        assert_true(offers.items[0].price_per_gram == 0.02);
        assert_true(offers.items[0].container_g == 1000);
        assert_true(offers.items[0].lead_days == 3);
    } else {
        assert_null(offers.items[0].code);
        assert_true(offers.items[0].price_per_gram < 0);
    }
    assert_int_equal(find(d, catalogue, "CO").count, 0);
    bs_catalogue_close(catalogue);
}

static void build__every_format(void **state)
{
    static const char smi[] = "CCO ethanol, absolute\nC1=CC=CC=C1\tbenzene\n";
    static const char tsv[] = "code\tname\tsmiles\tprice_per_gram_eur\tpack_g\tlead_days\n"
                              "E-1\tethanol, absolute\tC(C)O\t0.02\t1000\t3\n"
                              "B-1\tbenzene\tc1ccccc1\t\t\t\n";
    static const char csv[] = "\xEF\xBB\xBFsmiles,name,code,price_per_gram,container_g,lead_days\r\n"
                              "CCO,\"ethanol, absolute\",E-1,0.02,1000,3\r\n"
                              "c1ccccc1,benzene\r\n";
    folder *d = *state;

    check_format(d, "a.smi", smi, false);
    check_format(d, "a.smi.gz", smi, false);
    check_format(d, "a.tsv", tsv, true);
    check_format(d, "a.tsv.gz", tsv, true);
    check_format(d, "a.csv", csv, true);
    check_format(d, "a.csv.gz", csv, true);
}

/* Ethanol as a molfile writes it: three atoms, two bonds. */
#define ETHANOL                                                                                    \
    "\n\n\n  3  2  0  0  0  0            999 V2000\n"                                               \
    "    0.0000    0.0000    0.0000 C   0  0\n"                                                    \
    "    1.2990    0.7500    0.0000 C   0  0\n"                                                    \
    "    2.5981    0.0000    0.0000 O   0  0\n"                                                    \
    "  1  2  1  0\n  2  3  1  0\nM  END\n"

static void build__sd_file_with_data_fields(void **state)
{
    static const char text[] = "title" ETHANOL
                               ">  <Code>\nE-1\n\n> <name>\nethanol, absolute\n\n"
                               ">  <price_per_gram>\n0.02\n\n> <PACK_G>\n1000\n\n"
                               "> <lead days>\n3\n\n$$$$\n"
                               "broken\n\n\nnot a count line\nM  END\n$$$$\n"
                               "from the title" ETHANOL "> <price_per_gram>\n0,5\n\n$$$$\n"
                               "dear" ETHANOL "> <price_per_gram>\nask\n\n$$$$\n";
    folder *d = *state;
    bs_import_report report;
    bs_catalogue *catalogue = build_and_open(d, "a.sdf.gz", text, &report);
    bs_offers offers = find(d, catalogue, "OCC");

    assert_int_equal(report.lines, 4);
    assert_int_equal(report.refused, 2);
    assert_int_equal(offers.count, 2);
    assert_string_equal(offers.items[0].code, "E-1");
    assert_string_equal(offers.items[0].name, "ethanol, absolute");
    assert_true(offers.items[0].price_per_gram == 0.02);
    assert_true(offers.items[0].container_g == 1000);
    assert_true(offers.items[0].lead_days == 3);
    assert_string_equal(offers.items[1].name, "from the title");
    assert_true(offers.items[1].price_per_gram == 0.5);
    assert_non_null(strstr(report.first_refused, "a.sdf.gz', line "));
    bs_catalogue_close(catalogue);
}

static void build__several_lists_into_one(void **state)
{
    folder *d = *state;
    const char *inputs[] = { folder_puts(d, "a.smi", "CCO\nCO\n"),
                             folder_puts(d, "b.csv", "smiles,price_per_gram\nOCC,2\nC,3\n") };
    const char *output = folder_name(d, "both.catalogue");
    bs_import_report report;
    bs_catalogue *catalogue;

    check_ok(d->f, bs_catalogue_build(&d->f->cx, inputs, 2, output, &report));
    assert_int_equal(report.offers, 4);
    check_ok(d->f, bs_catalogue_open(&d->f->cx, output, &catalogue));
    assert_int_equal(find(d, catalogue, "CCO").count, 2);
    bs_catalogue_close(catalogue);
}

static void build__refused_lines_are_counted(void **state)
{
    folder *d = *state;
    bs_import_report report;
    bs_catalogue *catalogue =
        build_and_open(d, "a.csv",
                       "name,smiles,price_per_gram\n"
                       "ethanol,CCO,1\n"
                       "open ring,C1CC,1\n"
                       "no price,C,on request\n"
                       "nothing,,1\n"
                       "unknown,*C,1\n"
                       "two words,CC O,1\n"
                       "water,O,0.001\n",
                       &report);

    assert_int_equal(report.lines, 7);
    assert_int_equal(report.offers, 2);
    assert_int_equal(report.refused, 5);
    assert_int_equal(report.first_refused_line, 3);
    assert_non_null(strstr(report.first_refused, "a.csv', line 3: "));
    assert_int_equal(bs_catalogue_count(catalogue), 2);
    bs_catalogue_close(catalogue);
}

static void build__hostile_lines_are_refused(void **state)
{
    folder *d = *state;
    size_t length = 1000000, used = 0;
    char *text = malloc(4 * length);
    bs_import_report report;

    assert_non_null(text);
    /* A million atoms; a million branches; a NUL; two megabytes; then a good line. */
    memset(text, 'C', length);
    text[length] = '\n';
    used = length + 1;
    memset(text + used, '(', length);
    used += length;
    text[used++] = '\n';
    memcpy(text + used, "C\0C\n", 4);
    used += 4;
    memset(text + used, 'C', length + length / 2);
    used += length + length / 2;
    memcpy(text + used, "\nCCO\n", 5);
    used += 5;
    check_ok(d->f, build(d, folder_write(d, "a.smi", text, used), folder_name(d, "out"), &report));
    assert_int_equal(report.offers, 1);
    assert_int_equal(report.refused, 4);
    free(text);
}

static void build__names_become_clean_utf8(void **state)
{
    folder *d = *state;
    bs_import_report report;
    bs_catalogue *catalogue =
        build_and_open(d, "a.smi", "C \xCE\xB1-pinene\nCC na\xEFve \xED\xA0\x80 \xC0\xAF\n", &report);

    assert_string_equal(find(d, catalogue, "C").items[0].name, "\xCE\xB1-pinene");
    assert_string_equal(find(d, catalogue, "CC").items[0].name,
                        "na\xEF\xBF\xBDve \xEF\xBF\xBD\xEF\xBF\xBD\xEF\xBF\xBD \xEF\xBF\xBD\xEF\xBF\xBD");
    bs_catalogue_close(catalogue);
}

/* ---- What comes out -------------------------------------------------------------------- */

static void find__any_spelling(void **state)
{
    static const char *const spellings[][3] = {
        { "CC(=O)Oc1ccccc1C(=O)O", "OC(=O)C1=CC=CC=C1OC(C)=O", "c1(C(O)=O)c(OC(=O)C)cccc1" },
        { "C[C@H](N)C(=O)O", "[C@H](C)(C(O)=O)N", "OC(=O)[C@H](C)N" },
        { "C/C=C/C", "C\\C=C\\C", "[CH3]/[CH]=[CH]/[CH3]" },
        { "[Na+].[C-]#N", "N#[C-].[Na+]", "[Na+].N#[C-]" },
        { "c1ccc2[nH]ccc2c1", "C1=CC=C2NC=CC2=C1", "[nH]1ccc2ccccc12" },
        { "C[N+](=O)[O-]", "[O-][N+](C)=O", "O=[N+]([O-])C" },
    };
    folder *d = *state;
    bs_import_report report;
    char text[1000] = "";
    bs_catalogue *catalogue;

    for (int i = 0; i < 6; i++) {
        strcat(text, spellings[i][0]);
        strcat(text, "\n");
    }
    catalogue = build_and_open(d, "a.smi", text, &report);
    assert_int_equal(report.offers, 6);
    for (int i = 0; i < 6; i++) {
        for (int k = 0; k < 3; k++) {
            if (find(d, catalogue, spellings[i][k]).count != 1)
                fail_msg("%s was not found", spellings[i][k]);
        }
    }
    assert_int_equal(find(d, catalogue, "C[C@@H](N)C(=O)O").count, 0);
    assert_int_equal(find(d, catalogue, "C/C=C\\C").count, 0);
    assert_int_equal(find(d, catalogue, "CC=CC").count, 0);
    bs_catalogue_close(catalogue);
}

static void find__cheapest_first_unpriced_last(void **state)
{
    static const char *const want[] = { "d", "b", "e", "a", "c" };
    folder *d = *state;
    bs_import_report report;
    bs_catalogue *catalogue = build_and_open(d, "a.csv",
                                             "smiles,code,price_per_gram\n"
                                             "C,a,\nC,b,2\nC,c,\nC,d,1.5\nC,e,2\n",
                                             &report);
    bs_offers offers = find(d, catalogue, "C");

    assert_int_equal(offers.count, 5);
    for (int i = 0; i < 5; i++)
        assert_string_equal(offers.items[i].code, want[i]);
    bs_catalogue_close(catalogue);
}

static void find__failed_allocations_leave_nothing(void **state)
{
    folder *d = *state;
    bs_import_report report;
    bs_catalogue *catalogue = build_and_open(d, "a.smi", "CCO ethanol\n", &report);
    const bs_mol *mol = read_mol(d, "CCO");
    bs_gate *gate = d->f->cx.gate;
    bs_offers offers;
    bs_status st = BS_ENOMEM;

    for (long n = 0; st == BS_ENOMEM && n < 10000; n++) {
        size_t live = d->f->home.live;

        atomic_store(&gate->fail_after, n);
        st = bs_catalogue_find(&d->f->cx, &d->f->home, catalogue, mol, &offers);
        atomic_store(&gate->fail_after, -1);
        if (st == BS_ENOMEM) {
            assert_int_equal(d->f->home.live, live);
            assert_int_equal(offers.count, 0);
        }
    }
    check_ok(d->f, st);
    assert_int_equal(offers.count, 1);
    bs_catalogue_close(catalogue);
}

/* ---- The file -------------------------------------------------------------------------- */

static void build__same_input_same_bytes(void **state)
{
    folder *d = *state;
    const char *input = folder_puts(d, "a.smi", "CCO ethanol\nCO methanol\nc1ccccc1\n");
    bs_import_report report;
    size_t length[2];
    char *bytes[2];

    check_ok(d->f, build(d, input, folder_name(d, "1"), &report));
    check_ok(d->f, build(d, input, folder_name(d, "2"), &report));
    bytes[0] = folder_slurp(folder_name(d, "1"), &length[0]);
    bytes[1] = folder_slurp(folder_name(d, "2"), &length[1]);
    assert_int_equal(length[0], length[1]);
    assert_memory_equal(bytes[0], bytes[1], length[0]);
    free(bytes[0]);
    free(bytes[1]);
}

/* Builds from a bad input over a good catalogue: it must stay as it was, and alone. */
static void check_stays_whole(folder *d, const char *input, bs_status want, const char *message)
{
    const char *output = folder_name(d, "out.catalogue");
    bs_import_report report;
    size_t before_length, after_length;
    char *before, *after;
    int files;

    check_ok(d->f, build(d, folder_puts(d, "good.smi", "CCO\n"), output, &report));
    before = folder_slurp(output, &before_length);
    files = folder_count(d);
    assert_int_equal(build(d, input, output, &report), want);
    if (!strstr(d->f->cx.error.message, message))
        fail_msg("the message is: %s", d->f->cx.error.message);
    assert_int_equal(folder_count(d), files);
    after = folder_slurp(output, &after_length);
    assert_int_equal(before_length, after_length);
    assert_memory_equal(before, after, before_length);
    free(before);
    free(after);
}

static void build__failure_leaves_the_older_one_whole(void **state)
{
    folder *d = *state;

    check_stays_whole(d, folder_puts(d, "a.tsv", "name\nCCO\n"), BS_ESYNTAX, "column 'smiles'");
    check_stays_whole(d, folder_puts(d, "a.csv", "smiles,name\nC,\"x\n"), BS_ESYNTAX, "quote");
    check_stays_whole(d, folder_name(d, "none.smi"), BS_EFILE, "No such file");
    check_stays_whole(d, folder_puts(d, "a.doc", "C"), BS_EFILE, "must end in");
    check_stays_whole(d, folder_puts(d, "b.smi", "this\nis no list\n"), BS_EVALUE,
                      "no line could be used");
    check_stays_whole(d, folder_puts(d, "c.smi", "\n\n"), BS_EVALUE, "holds no compound");
    check_stays_whole(d, folder_write(d, "d.smi", "\x1f\x8b\x08\x00\x00\x00\x00\x00\x00\x03", 10),
                      BS_EFILE, "cut short");
}

static void build__stop_leaves_the_older_one_whole(void **state)
{
    folder *d = *state;
    const char *input = folder_puts(d, "a.smi", "CO\n"), *output = folder_name(d, "out");
    bs_import_report report;
    bs_catalogue *catalogue;

    check_ok(d->f, build(d, folder_puts(d, "b.smi", "CCO\n"), output, &report));
    atomic_store(d->f->cx.stop, true);
    assert_int_equal(build(d, input, output, &report), BS_ESTOPPED);
    atomic_store(d->f->cx.stop, false);
    assert_int_equal(folder_count(d), 3);
    check_ok(d->f, bs_catalogue_open(&d->f->cx, output, &catalogue));
    assert_int_equal(find(d, catalogue, "CCO").count, 1);
    bs_catalogue_close(catalogue);
}

static void build__failed_allocations_leave_no_file(void **state)
{
    folder *d = *state;
    const char *input = folder_puts(d, "a.csv", "smiles,name\nCCO,x\nC,y\n");
    const char *output = folder_name(d, "out");
    bs_gate *gate = d->f->cx.gate;
    bs_import_report report;
    bs_status st = BS_ENOMEM;

    for (long n = 0; st == BS_ENOMEM && n < 10000; n++) {
        atomic_store(&gate->fail_after, n);
        st = build(d, input, output, &report);
        atomic_store(&gate->fail_after, -1);
        assert_int_equal(folder_count(d), st == BS_OK ? 2 : 1);
    }
    check_ok(d->f, st);
}

static void build__other_files_are_not_overwritten(void **state)
{
    folder *d = *state;
    const char *input = folder_puts(d, "a.smi", "CCO\n"), *list = folder_puts(d, "b.smi", "CO\n");
    bs_import_report report;
    size_t length;
    char *bytes;

    assert_int_equal(build(d, input, list, &report), BS_EFILE);
    assert_non_null(strstr(d->f->cx.error.message, "is no catalogue; it is not overwritten"));
    bytes = folder_slurp(list, &length);
    assert_int_equal(length, 3);
    assert_memory_equal(bytes, "CO\n", 3);
    free(bytes);
    assert_int_equal(build(d, input, d->path, &report), BS_EFILE);
    assert_int_equal(build(d, input, folder_name(d, "no/such/folder"), &report), BS_EFILE);
    assert_non_null(strstr(d->f->cx.error.message, "cannot write"));
}

static void build__link_is_followed(void **state)
{
    folder *d = *state;
    const char *input = folder_puts(d, "a.smi", "CCO\n");
    bs_import_report report;
    char target[8];

    check_ok(d->f, build(d, input, folder_name(d, "real"), &report));
    assert_int_equal(symlink("real", folder_name(d, "link")), 0);
    check_ok(d->f, build(d, input, folder_name(d, "link"), &report));
    assert_int_equal(readlink(folder_name(d, "link"), target, sizeof target), 4);
    assert_int_equal(folder_count(d), 3);
}

int main(void)
{
    const struct CMUnitTest tests[] = {
        folder_case(build__every_format),
        folder_case(build__sd_file_with_data_fields),
        folder_case(build__several_lists_into_one),
        folder_case(build__refused_lines_are_counted),
        folder_case(build__hostile_lines_are_refused),
        folder_case(build__names_become_clean_utf8),
        folder_case(find__any_spelling),
        folder_case(find__cheapest_first_unpriced_last),
        folder_case(find__failed_allocations_leave_nothing),
        folder_case(build__same_input_same_bytes),
        folder_case(build__failure_leaves_the_older_one_whole),
        folder_case(build__stop_leaves_the_older_one_whole),
        folder_case(build__failed_allocations_leave_no_file),
        folder_case(build__other_files_are_not_overwritten),
        folder_case(build__link_is_followed),
    };

    return cmocka_run_group_tests(tests, NULL, NULL);
}
