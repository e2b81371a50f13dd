/* Reads the tables of tests/data line by line: plain or gzip, fields between tabs. */
#ifndef SUPPORT_TABLE_H
#define SUPPORT_TABLE_H

#include <stdio.h>
#include <string.h>
#include <zlib.h>

#include "support/check.h"

enum { TABLE_LINE_MAX = 1 << 16, TABLE_FIELDS_MAX = 32 };

typedef struct table {
    gzFile file;
    int field_count;
    const char *field[TABLE_FIELDS_MAX];
    char line[TABLE_LINE_MAX];
} table;

/* Opens tests/data/<name>; the test fails if it is not there. */
static inline void table_open(table *t, const char *name)
{
    char path[1024];

    snprintf(path, sizeof path, "%s/%s", BACKSAW_TEST_DATA, name);
    t->file = gzopen(path, "rb");
    if (!t->file)
        fail_msg("cannot open %s", path);
}

/* Reads the next line and cuts it into fields; false at the end, when the file is closed. */
static inline bool table_next(table *t)
{
    char *at = t->line;

    if (!gzgets(t->file, t->line, sizeof t->line)) {
        gzclose(t->file);
        return false;
    }
    t->line[strcspn(t->line, "\r\n")] = '\0';
    t->field_count = 0;
    while (at && t->field_count < TABLE_FIELDS_MAX) {
        t->field[t->field_count++] = at;
        at = strchr(at, '\t');
        if (at)
            *at++ = '\0';
    }
    return true;
}

#endif
