/* Names and data fields of files in unknown encodings. */
#ifndef FORMAT_UTF8_H
#define FORMAT_UTF8_H

#include "backsaw/core.h"

/*
 * A copy of the text in `home` as UTF-8, with a NUL behind. Text that is no UTF-8 is taken for
 * Latin-1, the usual encoding of old files.
 */
bs_status bs_utf8__copy(bs_ctx *cx, bs_arena *home, const char *text, size_t length, char **out,
                        size_t *out_length);

#endif
