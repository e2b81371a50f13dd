/*
 * The lines of a file, plain or gzip, one after the other in constant memory.
 *
 * Whether a file is gzip is seen by its first bytes, not by its name. A line ends at LF or CRLF;
 * the last one may lack its end. A mark of the byte order at the start of the file is left out.
 */
#ifndef CORE_LINES_H
#define CORE_LINES_H

#include "backsaw/core.h"

typedef struct bs_lines bs_lines;

/*
 * Opens a regular file.
 *
 *   longest  bytes of the longest line that is handed out
 *   errors   BS_EFILE, BS_ENOMEM; *out is NULL
 */
bs_status bs_lines_open(bs_ctx *cx, const char *path, size_t longest, bs_lines **out);

/* Closes; NULL is allowed. */
void bs_lines_close(bs_lines *lines);

/*
 * The next line without its end, valid until the next call; *text is NULL at the end of the file.
 * The text may hold NUL bytes and is not ended by one.
 *
 *   errors  BS_ELIMIT   the line is too long: the next call goes on behind it. Or a gzip file
 *                       expands out of all proportion
 *           BS_EFILE    it cannot be read, or the gzip data are damaged or cut short
 *           BS_ESTOPPED, BS_ENOMEM
 */
bs_status bs_lines_next(bs_lines *lines, const char **text, size_t *length);

/* The number of the line that was handed out or refused last, 1-based; 0 before the first. */
long bs_lines_number(const bs_lines *lines);

/* Whether the file can be read on after an error: true only after a line that was too long. */
bool bs_lines_can_go_on(const bs_lines *lines);

#endif
