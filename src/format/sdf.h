/* The data fields of SD records. */
#ifndef FORMAT_SDF_H
#define FORMAT_SDF_H

#include "format/molfile.h"

enum { BS_SDF_MAX_FIELDS = 10000 };

/*
 * Reads a record: a molfile and its data fields, without the `$$$$`. `first_line` is the number of
 * its first line in the file.
 */
bs_status bs_sdf__read(bs_ctx *cx, bs_arena *home, const char *text, size_t length, long first_line,
                       bs_record *out);

#endif
