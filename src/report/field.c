/* The fields of field.h. */
#include "report/field.h"

#include "backsaw/format.h"

#include <stdio.h>
#include <string.h>

void bs_field__enter(bs_reader *r, const char *key, size_t index)
{
    if (r->depth < BS_READER_DEPTH)
        r->steps[r->depth] = (bs_place_step){key, index};
    r->depth++;
}

void bs_field__leave(bs_reader *r)
{
    r->depth--;
}

/* "routes[2].steps[1].yield", entries from 1; an empty text for the outermost value. */
static void write_way(const bs_reader *r, char *out, size_t size)
{
    size_t used = 0;

    out[0] = '\0';
    for (int i = 0; i < r->depth && i < BS_READER_DEPTH && used < size; i++) {
        const bs_place_step *step = &r->steps[i];
        int more = step->key ? snprintf(out + used, size - used, "%s%s", i ? "." : "", step->key)
                             : snprintf(out + used, size - used, "[%zu]", step->index + 1);

        used += more > 0 ? (size_t)more : 0;
    }
}

bs_status bs_field__refuse(bs_reader *r, bs_status code, const char *what)
{
    char way[160], message[BS_MESSAGE_MAX];
    long line = bs_place__line(r->text, r->length, r->steps,
                               r->depth < BS_READER_DEPTH ? r->depth : BS_READER_DEPTH);

    snprintf(message, sizeof message, "%s", what); /* `what` may be the message of the context */
    write_way(r, way, sizeof way);
    bs_fail(r->cx, code, "%s: line %ld: %s%s%s", r->path, line, way, way[0] ? ": " : "", message);
    r->cx->error.line = line;
    return code;
}

/* ---- Fields ---------------------------------------------------------------------------------- */

bs_status bs_field__refuse_in(bs_reader *r, const char *key, const char *what)
{
    bs_status st;

    bs_field__enter(r, key, 0);
    st = bs_field__refuse(r, BS_ESYNTAX, what);
    bs_field__leave(r);
    return st;
}

bs_status bs_field__get(bs_reader *r, const json_t *object, const char *key, int needed,
                        json_t **out)
{
    *out = json_object_get(object, key);
    if (json_is_null(*out))
        *out = NULL;
    return needed && !*out ? bs_field__refuse_in(r, key, "is missing") : BS_OK;
}

bs_status bs_field__list(bs_reader *r, const json_t *object, const char *key, int needed,
                         json_t **out)
{
    bs_status st = bs_field__get(r, object, key, needed, out);

    if (st == BS_OK && *out && !json_is_array(*out))
        st = bs_field__refuse_in(r, key, "a list is expected");
    return st;
}

bs_status bs_field__text(bs_reader *r, bs_arena *home, const json_t *object, const char *key,
                         int needed, const char **out)
{
    json_t *value;
    char *copy = NULL;
    bs_status st = bs_field__get(r, object, key, needed, &value);

    *out = NULL;
    if (st != BS_OK || !value)
        return st;
    if (!json_is_string(value))
        return bs_field__refuse_in(r, key, "a string is expected");
    st = bs_copy_text(r->cx, home, json_string_value(value), json_string_length(value), &copy);
    *out = copy;
    return st;
}

bs_status bs_field__number(bs_reader *r, const json_t *object, const char *key, int needed,
                           double least, double *out)
{
    json_t *value;
    bs_status st = bs_field__get(r, object, key, needed, &value);

    if (st != BS_OK || !value)
        return st;
    if (!json_is_number(value))
        return bs_field__refuse_in(r, key, "a number is expected");
    if (!(json_number_value(value) >= least))
        return bs_field__refuse_in(r, key,
                                   least > 0 ? "a number above 0 is expected"
                                             : "a number of 0 or more is expected");
    *out = json_number_value(value);
    return BS_OK;
}

bs_status bs_field__flag(bs_reader *r, const json_t *object, const char *key, int needed, bool *out)
{
    json_t *value;
    bs_status st = bs_field__get(r, object, key, needed, &value);

    if (st != BS_OK || !value)
        return st;
    if (!json_is_boolean(value))
        return bs_field__refuse_in(r, key, "true or false is expected");
    *out = json_is_true(value);
    return BS_OK;
}

bs_status bs_field__words(bs_reader *r, const json_t *object, const char *key, const char ***items,
                          int *count)
{
    json_t *list;
    bs_status st = bs_field__list(r, object, key, BS_FIELD_OPTIONAL, &list);
    size_t n = json_array_size(list);

    if (st != BS_OK || n == 0 || (st = bs_new(r->cx, &r->temp, n, items)) != BS_OK)
        return st;
    bs_field__enter(r, key, 0);
    for (size_t i = 0; st == BS_OK && i < n; i++) {
        const json_t *value = json_array_get(list, i);

        bs_field__enter(r, NULL, i);
        if (!json_is_string(value))
            st = bs_field__refuse(r, BS_ESYNTAX, "a string is expected");
        (*items)[i] = json_string_value(value); /* the document lives as long as `temp` */
        bs_field__leave(r);
    }
    bs_field__leave(r);
    *count = (int)n;
    return st;
}

bs_status bs_field__read_smiles(bs_reader *r, bs_arena *home, const json_t *value, const char **out)
{
    bs_mark mark = bs_arena_mark(&r->temp);
    const char *text = json_string_value(value);
    char *canonical = NULL, *copy = NULL;
    bs_mol *mol;
    bs_status st;

    if (!text)
        return bs_field__refuse(r, BS_ESYNTAX, "a SMILES is expected");
    st = bs_smiles_read(r->cx, &r->temp, text, strlen(text), NULL, &mol);
    if (st == BS_OK)
        st = bs_smiles_canonical(r->cx, &r->temp, mol, 0, &canonical);
    if (st == BS_ENOMEM)
        return st;
    if (st != BS_OK)
        return bs_field__refuse(r, st, r->cx->error.message);
    if (home == &r->temp) {
        *out = canonical;
        return BS_OK;
    }
    st = bs_copy_text(r->cx, home, canonical, strlen(canonical), &copy);
    bs_arena_rewind(&r->temp, mark);
    *out = copy;
    return st;
}

bs_status bs_field__smiles(bs_reader *r, bs_arena *home, const json_t *object, const char *key,
                           int needed, const char **out)
{
    json_t *value;
    bs_status st = bs_field__get(r, object, key, needed, &value);

    *out = NULL;
    if (st != BS_OK || !value)
        return st;
    bs_field__enter(r, key, 0);
    st = bs_field__read_smiles(r, home, value, out);
    bs_field__leave(r);
    return st;
}
