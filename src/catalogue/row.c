/* Lists: the formats, the header line and the rows. */
#include "catalogue/row.h"

#include <math.h>
#include <stdio.h>
#include <string.h>
#include <strings.h>

/* ---- Formats --------------------------------------------------------------------------- */

typedef struct format {
    const char *ending;
    int separator;
    bool quotes, table, sd;
} format;

static const format formats[] = {
    {".smi", -1, false, false, false},
    {".tsv", '\t', false, true, false},
    {".csv", ',', true, true, false},
    {".sdf", -1, false, false, true},
};

static bool ends_in(const char *path, size_t length, const char *ending)
{
    size_t n = strlen(ending);

    return length >= n && strncasecmp(path + length - n, ending, n) == 0;
}

static const format *find_format(const char *path)
{
    size_t length = strlen(path);

    if (ends_in(path, length, ".gz"))
        length -= 3;
    for (size_t i = 0; i < sizeof formats / sizeof *formats; i++) {
        if (ends_in(path, length, formats[i].ending))
            return &formats[i];
    }
    return NULL;
}

/* ---- Header ---------------------------------------------------------------------------- */

static const struct {
    const char *name;
    bs_column column;
} columns[] = {
    {"smiles", BS_COLUMN_SMILES},
    {"code", BS_COLUMN_CODE},
    {"name", BS_COLUMN_NAME},
    {"price_per_gram", BS_COLUMN_PRICE},
    {"price_per_gram_eur", BS_COLUMN_PRICE},
    {"pack_g", BS_COLUMN_CONTAINER},
    {"container_g", BS_COLUMN_CONTAINER},
    {"lead_days", BS_COLUMN_LEAD},
};

static bs_slice trim(const char *text, size_t length)
{
    while (length > 0 && (*text == ' ' || *text == '\t'))
        text++, length--;
    while (length > 0 && (text[length - 1] == ' ' || text[length - 1] == '\t'))
        length--;
    return (bs_slice){length ? text : "", length};
}

static bs_slice field(const bs_records *r, int index)
{
    if (index < 0 || index >= r->field_count || index >= BS_RECORD_FIELDS)
        return (bs_slice){"", 0};
    return trim(r->text.data + r->fields[index].at, r->fields[index].length);
}

/* Compares a heading with a column's name; case, spaces and hyphens make no difference. */
static bool is_column(bs_slice heading, const char *name)
{
    for (size_t i = 0; i < heading.length; i++, name++) {
        char c = heading.text[i];

        if (c >= 'A' && c <= 'Z')
            c = (char)(c - 'A' + 'a');
        if (c == ' ' || c == '-')
            c = '_';
        if (c != *name)
            return false;
    }
    return *name == '\0';
}

static bs_status fail_header(bs_rows *rows, const char *problem)
{
    bs_ctx *cx = rows->records.cx;

    bs_fail(cx, BS_ESYNTAX, "'%.200s': the header line %s", rows->records.path, problem);
    cx->error.line = rows->records.line;
    return BS_ESYNTAX;
}

static bs_status read_header(bs_rows *rows)
{
    bs_records *r = &rows->records;
    bool more;
    bs_status st;

    for (int i = 0; i < BS_COLUMN_COUNT; i++)
        rows->place[i] = -1;
    if ((st = bs_records__next(r, &more)) != BS_OK)
        return st;
    if (!more)
        return fail_header(rows, "is missing: the file is empty");
    if (r->fault)
        return fail_header(rows, "is no text, or is longer than 1 MiB");
    if (r->field_count > BS_RECORD_FIELDS)
        return fail_header(rows, "names more than 256 columns");
    rows->width = r->field_count;
    for (int i = 0; i < rows->width; i++) {
        for (size_t k = 0; k < sizeof columns / sizeof *columns; k++) {
            int *place = &rows->place[columns[k].column];

            if (!is_column(field(r, i), columns[k].name))
                continue;
            if (*place >= 0)
                return fail_header(rows, "names one column twice");
            *place = i;
        }
    }
    if (rows->place[BS_COLUMN_SMILES] < 0)
        return fail_header(rows, "names no column 'smiles'");
    return BS_OK;
}

bs_status bs_rows__open(bs_ctx *cx, const char *path, bs_rows *out)
{
    const format *f = find_format(path);
    bs_status st;

    out->file = NULL;
    bs_arena_init(&out->home, cx->gate);
    if (!f)
        return bs_fail(cx, BS_EFILE,
                       "'%.200s' is no list: its name must end in .smi, .tsv, .csv or .sdf, or in "
                       "one of these and .gz",
                       path);
    out->table = f->table;
    out->records.cx = cx;
    if (f->sd)
        return bs_file_open(cx, path, &(bs_file_options){.kind = BS_FILE_SDF}, &out->file);
    if ((st = bs_records__open(cx, path, f->separator, f->quotes, &out->records)) != BS_OK)
        return st;
    if (f->table && (st = read_header(out)) != BS_OK)
        bs_rows__close(out);
    return st;
}

void bs_rows__close(bs_rows *rows)
{
    if (rows->file)
        bs_file_close(rows->file);
    else
        bs_records__close(&rows->records);
    bs_arena_free(&rows->home);
}

/* ---- Numbers --------------------------------------------------------------------------- */

/* Reads digits with one point; counts the digits and those behind the point. */
static size_t read_digits(const char *text, size_t length, bool comma, double *mantissa, int *shift)
{
    bool point = false;
    int digits = 0, kept = 0;
    size_t i;

    *mantissa = 0;
    *shift = 0;
    for (i = 0; i < length; i++) {
        char c = text[i];

        if (!point && (c == '.' || (comma && c == ','))) {
            point = true;
            continue;
        }
        if (c < '0' || c > '9')
            break;
        digits++;
        /* 15 digits are exact in a double, and more than any price has. */
        if (kept < 15) {
            *mantissa = *mantissa * 10 + (c - '0');
            kept += *mantissa > 0;
            *shift -= point;
        } else {
            *shift += !point;
        }
    }
    return digits > 0 ? i : 0;
}

bool bs_row__number(const char *text, size_t length, bool comma, double *out)
{
    double mantissa;
    int shift, exponent = 0;
    bool negative = false;
    size_t at;

    if (length > 40 || (at = read_digits(text, length, comma, &mantissa, &shift)) == 0)
        return false;
    if (at < length && (text[at] == 'e' || text[at] == 'E')) {
        size_t first;

        at++;
        if (at < length && (text[at] == '+' || text[at] == '-'))
            negative = text[at++] == '-';
        for (first = at; at < length && at - first < 3 && text[at] >= '0' && text[at] <= '9'; at++)
            exponent = exponent * 10 + (text[at] - '0');
        if (at == first)
            return false;
    }
    if (at < length)
        return false;
    shift += negative ? -exponent : exponent;
    /* One division by an exact power of ten rounds once (Clinger 1990). */
    *out = shift < 0 ? mantissa / pow(10, -shift) : mantissa * pow(10, shift);
    return isfinite(*out) && *out <= 1e15;
}

/* ---- Rows ------------------------------------------------------------------------------ */

static double number(bs_slice s, bool comma, bs_row *row, const char *fault)
{
    double value = -1;

    if (s.length == 0 || (s.length == 1 && *s.text == '-'))
        return -1;
    if (!bs_row__number(s.text, s.length, comma, &value)) {
        if (!row->fault)
            row->fault = fault;
        return -1;
    }
    return value;
}

/* Fills a row from the texts of its columns; `comma` allows decimal commas. */
static void fill(const bs_slice text[BS_COLUMN_COUNT], bool comma, bs_row *row)
{
    row->smiles = text[BS_COLUMN_SMILES];
    row->code = text[BS_COLUMN_CODE];
    row->name = text[BS_COLUMN_NAME];
    row->price_per_gram = number(text[BS_COLUMN_PRICE], comma, row,
                                 "the price per gram is no number of 0 or more");
    row->container_g = number(text[BS_COLUMN_CONTAINER], comma, row,
                              "the pack size in g is no number of 0 or more");
    row->lead_days = number(text[BS_COLUMN_LEAD], comma, row,
                            "the lead time in days is no number of 0 or more");
}

static void fill_from_table(bs_rows *rows, bs_row *row)
{
    const bs_records *r = &rows->records;
    bs_slice text[BS_COLUMN_COUNT];

    for (int i = rows->width; i < r->field_count && !row->fault; i++) {
        if (i >= BS_RECORD_FIELDS || field(r, i).length > 0)
            row->fault = "more fields than the header line has";
    }
    for (int i = 0; i < BS_COLUMN_COUNT; i++)
        text[i] = field(r, rows->place[i]);
    fill(text, r->separator != ',', row);
}

/* The first data field of each column's name counts; without a name, the record's own does. */
static void fill_from_record(const bs_record *record, bs_row *row)
{
    bs_slice text[BS_COLUMN_COUNT];

    for (int i = 0; i < BS_COLUMN_COUNT; i++)
        text[i] = (bs_slice){"", 0};
    for (int i = 0; i < record->field_count; i++) {
        const bs_field *f = &record->fields[i];

        for (size_t k = 0; k < sizeof columns / sizeof *columns; k++) {
            bs_slice *place = &text[columns[k].column];

            if (place->length == 0 && is_column(trim(f->name, f->name_length), columns[k].name))
                *place = trim(f->value, f->value_length);
        }
    }
    if (text[BS_COLUMN_NAME].length == 0)
        text[BS_COLUMN_NAME] = (bs_slice){record->name, record->name_length};
    fill(text, true, row);
    row->mol = record->mol;
}

/* Reads a record of an SD file; one that cannot be read is a fault if there is a way on. */
static bs_status next_record(bs_rows *rows, bs_row *row, bool *more)
{
    bs_ctx *cx = rows->records.cx;
    bs_record *record = NULL;
    bs_status st;

    bs_arena_free(&rows->home);
    st = bs_file_next(rows->file, &rows->home, &record);
    *more = st != BS_OK || record;
    row->line = bs_file_record_line(rows->file);
    if (st == BS_OK && record)
        fill_from_record(record, row);
    if (st == BS_OK || st == BS_ENOMEM || st == BS_ESTOPPED || !bs_file_can_go_on(rows->file))
        return st;
    snprintf(rows->fault, sizeof rows->fault, "%s", cx->error.message);
    row->fault = rows->fault;
    return BS_OK;
}

static void fill_from_line(bs_rows *rows, bs_row *row)
{
    bs_slice line = field(&rows->records, 0);
    size_t n = 0;

    while (n < line.length && line.text[n] != ' ' && line.text[n] != '\t')
        n++;
    row->smiles = (bs_slice){line.text, n};
    while (n < line.length && (line.text[n] == ' ' || line.text[n] == '\t'))
        n++;
    row->name = (bs_slice){line.text + n, line.length - n};
}

bs_status bs_rows__next(bs_rows *rows, bs_row *row, bool *more)
{
    bs_status st;

    *row = (bs_row){.smiles = {"", 0},
                    .code = {"", 0},
                    .name = {"", 0},
                    .price_per_gram = -1,
                    .container_g = -1,
                    .lead_days = -1};
    if (rows->file)
        return next_record(rows, row, more);
    st = bs_records__next(&rows->records, more);
    if (st != BS_OK || !*more)
        return st;
    row->line = rows->records.line;
    row->fault = rows->records.fault;
    if (rows->table)
        fill_from_table(rows, row);
    else
        fill_from_line(rows, row);
    if (!row->fault && row->smiles.length == 0)
        row->fault = "no SMILES";
    return BS_OK;
}
