/*
 * Rows of a list: what the fields of a record mean. A list is a .smi file (SMILES, blank, name),
 * a table with a header line, or an SD file whose data fields are named like columns; which, says
 * its name.
 */
#ifndef CATALOGUE_ROW_H
#define CATALOGUE_ROW_H

#include "catalogue/record.h"

#include "backsaw/file.h"

typedef enum bs_column {
    BS_COLUMN_SMILES,
    BS_COLUMN_CODE,
    BS_COLUMN_NAME,
    BS_COLUMN_PRICE,
    BS_COLUMN_CONTAINER,
    BS_COLUMN_LEAD,
    BS_COLUMN_COUNT
} bs_column;

typedef struct bs_rows {
    bs_file *file; /* of an SD file; NULL for the others, which use `records` */
    bs_arena home; /* of the SD record that was read last */
    char fault[BS_MESSAGE_MAX];
    bs_records records;
    bool table;
    int place[BS_COLUMN_COUNT]; /* field of each column, or -1 */
    int width;                  /* fields of the header */
} bs_rows;

/* A text of a row, in the reader's memory; length 0 where there is none. */
typedef struct bs_slice {
    const char *text;
    size_t length;
} bs_slice;

typedef struct bs_row {
    long line;
    const char *fault; /* why the row must be refused, or NULL */
    const bs_mol *mol; /* of an SD record, which has no SMILES; else NULL */
    bs_slice smiles, code, name;
    double price_per_gram, container_g, lead_days; /* -1 where the row says nothing */
} bs_row;

/*
 * Opens a list and reads its header.
 *
 *   errors  BS_EFILE    unreadable, or a name that does not tell the format
 *           BS_ESYNTAX  no smiles column, a column twice; error.line is set
 *           and those of bs_rows__next(); nothing is left open
 */
bs_status bs_rows__open(bs_ctx *cx, const char *path, bs_rows *out);
void bs_rows__close(bs_rows *rows);

/* Reads the next row; errors as bs_records__next(), or as bs_file_next() where that cannot go on. */
bs_status bs_rows__next(bs_rows *rows, bs_row *row, bool *more);

/*
 * Reads a number of digits with at most one point and an exponent; `comma` allows a decimal comma
 * too. The locale plays no part. False if it is none, negative or beyond 1e15.
 */
bool bs_row__number(const char *text, size_t length, bool comma, double *out);

#endif
