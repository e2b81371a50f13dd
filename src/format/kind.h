/* What the name of a file of molecules tells. */
#ifndef FORMAT_KIND_H
#define FORMAT_KIND_H

#include "backsaw/file.h"

/* The kind by the ending, BS_FILE_BY_NAME if it tells none; a .gz behind it makes no difference. */
bs_file_kind bs_file__kind(const char *path);

/* Whether the name ends in .gz. */
bool bs_file__is_gzip(const char *path);

#endif
