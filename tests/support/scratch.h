/* Files that a test writes into the folder in which it runs. */
#ifndef SUPPORT_SCRATCH_H
#define SUPPORT_SCRATCH_H

#include <stdio.h>
#include <stdlib.h>
#include <string.h>
#include <unistd.h>
#include <zlib.h>

#include "support/check.h"

/* Writes a file; `name` must belong to one test alone. */
static inline void scratch_write(const char *name, const char *text, size_t length)
{
    FILE *file = fopen(name, "wb");

    if (!file || fwrite(text, 1, length, file) != length || fclose(file) != 0)
        fail_msg("cannot write %s", name);
}

/* The same compressed, `times` times over. */
static inline void scratch_write_gzip(const char *name, const char *text, size_t length, long times)
{
    gzFile file = gzopen(name, "wb9");

    if (!file)
        fail_msg("cannot write %s", name);
    for (long i = 0; i < times; i++) {
        if (length > 0 && gzwrite(file, text, (unsigned)length) != (int)length)
            fail_msg("cannot write %s", name);
    }
    gzclose(file);
}

/* Cuts a file after `length` bytes. */
static inline void scratch_cut(const char *name, long length)
{
    if (truncate(name, length) != 0)
        fail_msg("cannot cut %s", name);
}

#endif
