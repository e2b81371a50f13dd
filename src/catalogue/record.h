/*
 * Records of a list: lines cut into fields, read as a stream from plain or gzip files.
 *
 * One reader serves all lists. Fields are cut at a separator, or not at all; with quotes, a field
 * may be quoted as in RFC 4180 and then hold separators and line ends. Lines end in LF, CRLF or
 * CR, a byte order mark is skipped, blank lines are passed over. Whatever the file holds, a
 * record keeps at most BS_RECORD_BYTES in memory.
 */
#ifndef CATALOGUE_RECORD_H
#define CATALOGUE_RECORD_H

#include "backsaw/core.h"

#include <zlib.h>

#define BS_RECORD_BYTES ((size_t)1 << 20)
#define BS_RECORD_FIELDS 256

/* Text that is read from one file at most, so that no small gzip file keeps us busy for ever. */
#define BS_RECORD_FILE_BYTES ((uint64_t)4 << 30)

#define BS_RECORD_BUFFER ((size_t)64 * 1024)

typedef struct bs_span {
    size_t at; /* in text.data */
    size_t length;
} bs_span;

typedef struct bs_records {
    bs_ctx *cx;
    const char *path;
    gzFile file;
    int separator; /* -1: a line is one field */
    bool quotes;

    /* The record that was read last. */
    long line; /* where it begins, 1-based */
    bs_text text;
    bs_span fields[BS_RECORD_FIELDS];
    int field_count;   /* may exceed BS_RECORD_FIELDS; the fields beyond are not kept */
    const char *fault; /* why the record must be refused, or NULL */

    long next_line;
    uint64_t total;
    bool after_cr;
    size_t at, filled;
    unsigned char buffer[BS_RECORD_BUFFER];
} bs_records;

/*
 * Opens a list. With `quotes`, the separator is the semicolon or the tab where the first line has
 * some and no comma, as spreadsheets write it in parts of Europe.
 *
 *   errors  BS_EFILE  not a readable regular file, UTF-16 text; nothing is left open
 */
bs_status bs_records__open(bs_ctx *cx, const char *path, int separator, bool quotes,
                           bs_records *out);

/* Closes the file and frees the text; harmless on a zeroed reader. */
void bs_records__close(bs_records *records);

/*
 * Reads the next record that is not blank. `more` is false at the end of the file.
 *
 *   errors  BS_ESYNTAX  a quote is not closed; error.line is set
 *           BS_EFILE    the file cannot be read on or is cut short
 *           BS_ELIMIT   more than BS_RECORD_FILE_BYTES of text
 *           BS_ESTOPPED
 */
bs_status bs_records__next(bs_records *records, bool *more);

#endif
