/* Writing JSON piece by piece. After a failure the writer does nothing more; ask its status. */
#ifndef REPORT_JSON_H
#define REPORT_JSON_H

#include "backsaw/core.h"

typedef struct bs_json {
    bs_text *text;
    bs_status status;
    int depth;
    int line;   /* from this depth on there are no line breaks; 0: everywhere */
    bool begun; /* something stands in the innermost object or list */
} bs_json;

void bs_json__open(bs_json *json, char bracket); /* '{' or '[' */

/* The same with all that is in it on one line. */
void bs_json__open_line(bs_json *json, char bracket);

void bs_json__close(bs_json *json, char bracket); /* '}' or ']' */

/* The name of the next value in an object. */
void bs_json__key(bs_json *json, const char *key);

/* Values. A number is written as short as it can be read back; one that is not finite is null. */
void bs_json__string(bs_json *json, const char *string); /* NULL: null; bad UTF-8 is replaced */
void bs_json__number(bs_json *json, double number);
void bs_json__flag(bs_json *json, bool flag);

/* The same with a name; NULL strings are left out. */
void bs_json__string_field(bs_json *json, const char *key, const char *string);
void bs_json__number_field(bs_json *json, const char *key, double number);
void bs_json__flag_field(bs_json *json, const char *key, bool flag);

/* A list of strings on one line, left out if it is empty. */
void bs_json__strings_field(bs_json *json, const char *key, const char *const *items, int count);

#endif
