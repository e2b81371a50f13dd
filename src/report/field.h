/*
 * The fields of a JSON file, taken one by one. What is not as expected is refused with the file,
 * the line and the way to the value.
 */
#ifndef REPORT_FIELD_H
#define REPORT_FIELD_H

#include "backsaw/rule.h"
#include "report/place.h"

#include <jansson.h>

#define BS_READER_DEPTH 8

/* The file that is read, and the way to the value at hand. */
typedef struct bs_reader {
    bs_ctx *cx;
    const char *path;
    const char *text;
    size_t length;
    const bs_rules *rules;
    const bs_rule_hooks *hooks;
    bs_arena *home; /* of the list */
    bs_arena temp;  /* of parts that are copied into a route */
    bs_place_step steps[BS_READER_DEPTH];
    int depth;
} bs_reader;

enum { BS_FIELD_OPTIONAL, BS_FIELD_NEEDED };

/* Goes to a field, or with NULL to an entry of a list; and back. */
void bs_field__enter(bs_reader *r, const char *key, size_t index);
void bs_field__leave(bs_reader *r);

/* Fails at the value at hand, or at a field of it. */
bs_status bs_field__refuse(bs_reader *r, bs_status code, const char *what);
bs_status bs_field__refuse_in(bs_reader *r, const char *key, const char *what);

/* The field of an object, NULL if it is missing or null. */
bs_status bs_field__get(bs_reader *r, const json_t *object, const char *key, int needed,
                        json_t **out);
bs_status bs_field__list(bs_reader *r, const json_t *object, const char *key, int needed,
                         json_t **out);

/* A string, copied into `home`; NULL if there is none. */
bs_status bs_field__text(bs_reader *r, bs_arena *home, const json_t *object, const char *key,
                         int needed, const char **out);

/* A number not below `least`, and a flag; they stay as they were if there is none. */
bs_status bs_field__number(bs_reader *r, const json_t *object, const char *key, int needed,
                           double least, double *out);
bs_status bs_field__flag(bs_reader *r, const json_t *object, const char *key, int needed,
                         bool *out);

/* A list of strings, which live as long as the document. */
bs_status bs_field__words(bs_reader *r, const json_t *object, const char *key, const char ***items,
                          int *count);

/* A SMILES in its canonical form in `home`: of the value at hand, and of a field. */
bs_status bs_field__read_smiles(bs_reader *r, bs_arena *home, const json_t *value,
                                const char **out);
bs_status bs_field__smiles(bs_reader *r, bs_arena *home, const json_t *object, const char *key,
                           int needed, const char **out);

#endif
