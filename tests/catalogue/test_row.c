/* Rows of lists: headers, numbers, formats. */
#include "catalogue/folder.h"

#include "catalogue/row.h"

/* The first row of a list, its texts copied. */
typedef struct first_row {
    bs_row row;
    char smiles[100], code[100], name[100];
} first_row;

static void copy(char out[100], bs_slice slice)
{
    assert_true(slice.length < 100);
    memcpy(out, slice.text, slice.length);
    out[slice.length] = '\0';
}

static bs_status read_first(folder *d, const char *file, const char *text, first_row *out)
{
    bs_rows *rows = calloc(1, sizeof *rows);
    bool more = false;
    bs_status st;

    assert_non_null(rows);
    st = bs_rows__open(&d->f->cx, folder_puts(d, file, text), rows);
    if (st == BS_OK && (st = bs_rows__next(rows, &out->row, &more)) == BS_OK) {
        assert_true(more);
        copy(out->smiles, out->row.smiles);
        copy(out->code, out->row.code);
        copy(out->name, out->row.name);
    }
    bs_rows__close(rows);
    free(rows);
    return st;
}

static void table__columns_in_any_order_and_case(void **state)
{
    folder *d = *state;
    first_row r;

    check_ok(d->f, read_first(d, "l.tsv",
                              "Lead days\tfolder\tSMILES\tPrice-per-gram\tpack_g\tCode\tNAME\n"
                              "14\tx\t CCO \t1.25\t500\tA-1\tethanol\n",
                              &r));
    assert_null(r.row.fault);
    assert_int_equal(r.row.line, 2);
    assert_string_equal(r.smiles, "CCO");
    assert_string_equal(r.code, "A-1");
    assert_string_equal(r.name, "ethanol");
    assert_true(r.row.price_per_gram == 1.25);
    assert_true(r.row.container_g == 500);
    assert_true(r.row.lead_days == 14);
}

static void table__other_names_of_columns(void **state)
{
    folder *d = *state;
    first_row r;

    check_ok(d->f,
             read_first(d, "l.CSV", "price_per_gram_eur,container_g,smiles\n0.5,2.5e1,C\n", &r));
    assert_true(r.row.price_per_gram == 0.5);
    assert_true(r.row.container_g == 25);
    assert_true(r.row.lead_days == -1);
    assert_int_equal(r.row.name.length, 0);
}

static void table__decimal_comma_where_the_comma_separates_nothing(void **state)
{
    folder *d = *state;
    first_row r;

    check_ok(d->f, read_first(d, "l.csv", "smiles;price_per_gram\nC;0,75\n", &r));
    assert_true(r.row.price_per_gram == 0.75);
    check_ok(d->f, read_first(d, "l.csv", "smiles,price_per_gram\nC,\"0,75\"\n", &r));
    assert_non_null(r.row.fault);
}

static void check_fault(folder *d, const char *text, const char *fault)
{
    first_row r;

    check_ok(d->f, read_first(d, "l.csv", text, &r));
    assert_non_null(r.row.fault);
    assert_string_equal(r.row.fault, fault);
}

static void table__faults(void **state)
{
    folder *d = *state;
    first_row r;

    check_fault(d, "smiles,price_per_gram\nC,on request\n",
                "the price per gram is no number of 0 or more");
    check_fault(d, "smiles,pack_g\nC,-1\n", "the pack size in g is no number of 0 or more");
    check_fault(d, "smiles,lead_days\nC,soon\n", "the lead time in days is no number of 0 or more");
    check_fault(d, "name,smiles\n1,2-ethanediol,OCCO\n", "more fields than the header line has");
    check_fault(d, "name,smiles\nwater\n", "no SMILES");
    check_ok(d->f, read_first(d, "l.csv", "smiles,price_per_gram,lead_days\nC,,-,,\n", &r));
    assert_null(r.row.fault);
    assert_true(r.row.price_per_gram == -1 && r.row.lead_days == -1);
}

static void check_header(folder *d, const char *text, const char *message, long line)
{
    first_row r;

    assert_int_equal(read_first(d, "l.tsv", text, &r), BS_ESYNTAX);
    assert_non_null(strstr(d->f->cx.error.message, message));
    assert_int_equal(d->f->cx.error.line, line);
}

static void table__header_errors(void **state)
{
    folder *d = *state;

    check_header(d, "name\tstructure\nx\tC\n", "names no column 'smiles'", 1);
    check_header(d, "\n\nsmile\n", "names no column 'smiles'", 3);
    check_header(d, "smiles\tname\tSmiles\n", "names one column twice", 1);
    check_header(d, "smiles\tprice_per_gram\tprice_per_gram_eur\n", "names one column twice", 1);
    check_header(d, "", "the file is empty", 1);
}

static void smi__name_is_the_rest_of_the_line(void **state)
{
    folder *d = *state;
    first_row r;

    check_ok(d->f, read_first(d, "l.smi", "  CCO\t ethyl alcohol \n", &r));
    assert_string_equal(r.smiles, "CCO");
    assert_string_equal(r.name, "ethyl alcohol");
    assert_int_equal(r.row.code.length, 0);
    check_ok(d->f, read_first(d, "l.smi.gz", "C", &r));
    assert_string_equal(r.smiles, "C");
    assert_string_equal(r.name, "");
}

static void open__other_names_are_refused(void **state)
{
    folder *d = *state;
    first_row r;

    assert_int_equal(read_first(d, "l.xlsx", "C", &r), BS_EFILE);
    assert_non_null(strstr(d->f->cx.error.message, "must end in .smi, .tsv, .csv or .sdf"));
    assert_int_equal(read_first(d, "smi", "C", &r), BS_EFILE);
}

static void number__decimal_text(void **state)
{
    static const struct {
        const char *text;
        double value;
    } good[] = {
        { "0", 0 },          { "7", 7 },
        { "0.017", 0.017 },  { ".5", .5 },
        { "5.", 5 },         { "1e3", 1000 },
        { "2.5E-2", 0.025 }, { "000.100", 0.1 },
        { "1e+2", 100 },     { "123456789012345", 123456789012345 },
        { "0.00000000000000000001", 1e-20 },
    };
    static const char *const bad[] = { "",     ".",    "-1",  "+1",   "1,5",   "1.2.3",
                                       "0x10", "1e",   "e5",  "inf",  "nan",   "1e16",
                                       "12 €", "1 2",  "1e400", "1e+-2" };
    double value;

    (void)state;
    for (size_t i = 0; i < sizeof good / sizeof *good; i++) {
        assert_true(bs_row__number(good[i].text, strlen(good[i].text), false, &value));
        if (value != good[i].value)
            fail_msg("%s gave %.17g", good[i].text, value);
    }
    for (size_t i = 0; i < sizeof bad / sizeof *bad; i++) {
        if (bs_row__number(bad[i], strlen(bad[i]), false, &value))
            fail_msg("'%s' was taken for a number", bad[i]);
    }
    assert_true(bs_row__number("1,5", 3, true, &value));
    assert_true(value == 1.5);
    assert_false(bs_row__number("1.234,5", 7, true, &value));
}

int main(void)
{
    const struct CMUnitTest tests[] = {
        folder_case(table__columns_in_any_order_and_case),
        folder_case(table__other_names_of_columns),
        folder_case(table__decimal_comma_where_the_comma_separates_nothing),
        folder_case(table__faults),
        folder_case(table__header_errors),
        folder_case(smi__name_is_the_rest_of_the_line),
        folder_case(open__other_names_are_refused),
        folder_case(number__decimal_text),
    };

    return cmocka_run_group_tests(tests, NULL, NULL);
}
