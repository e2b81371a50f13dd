/* Where a value stands in a JSON text, for messages: the parser keeps no lines. */
#ifndef REPORT_PLACE_H
#define REPORT_PLACE_H

#include "backsaw/core.h"

/* One step on the way to a value: a key of an object, or with NULL an entry of a list. */
typedef struct bs_place_step {
    const char *key;
    size_t index;
} bs_place_step;

/*
 * The line, from 1, of the value that the steps lead to from the outermost one; where a key or
 * entry is missing, that of what should have it. The text is sound JSON.
 */
long bs_place__line(const char *text, size_t length, const bs_place_step *steps, int count);

#endif
