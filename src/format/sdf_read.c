/*
 * Reading one record of an SD file.
 *
 * A value ends at a blank line. Values with blank lines in them occur all the same: lines behind a
 * blank line that start no new field go on with the value.
 */
#include "format/sdf.h"
#include "format/utf8.h"

#include <string.h>

typedef struct fields {
    bs_ctx *cx;
    bs_arena *home;
    bs_field *list;
    int count, room;
} fields;

static bool is_blank(const bs_scan *scan)
{
    for (size_t i = 0; i < scan->size; i++) {
        if (scan->at[i] != ' ' && scan->at[i] != '\t')
            return false;
    }
    return true;
}

static bs_status add_field(fields *f, bs_field **out)
{
    int room = f->room ? 2 * f->room : 8;
    bs_field *list;
    bs_status st;

    if (f->count == BS_SDF_MAX_FIELDS)
        return bs_fail(f->cx, BS_ELIMIT, "a record has at most %d data fields", BS_SDF_MAX_FIELDS);
    if (f->count == f->room) {
        if ((st = bs_new(f->cx, f->home, room, &list)) != BS_OK)
            return st;
        if (f->count > 0)
            memcpy(list, f->list, (size_t)f->count * sizeof *list);
        f->list = list;
        f->room = room;
    }
    *out = &f->list[f->count++];
    return BS_OK;
}

/*
 * The name in "> 25 <MELTING.POINT> (ID)": what stands between the first < and the last >, or all
 * behind the first > if there is no such thing.
 */
static void find_name(const bs_scan *scan, const char **name, size_t *length)
{
    const char *start = memchr(scan->at, '<', scan->size);
    const char *end = scan->at + scan->size;

    if (start) {
        while (end > start && end[-1] != '>')
            end--;
    }
    if (start && end - 1 > start) {
        *name = start + 1;
        *length = (size_t)(end - start) - 2;
        return;
    }
    start = scan->at + 1;
    end = scan->at + scan->size;
    while (start < end && *start == ' ')
        start++;
    while (end > start && end[-1] == ' ')
        end--;
    *name = start;
    *length = (size_t)(end - start);
}

/* Takes the carriage returns out of line ends. */
static size_t join_lines(char *text, size_t length)
{
    size_t used = 0;

    for (size_t i = 0; i < length; i++) {
        if (text[i] != '\r' || i + 1 >= length || text[i + 1] != '\n')
            text[used++] = text[i];
    }
    text[used] = '\0';
    return used;
}

/*
 * Reads a field; `scan` stands at its first line, and then at the line that starts the next one if
 * *more is true.
 */
static bs_status read_field(fields *f, bs_scan *scan, bool *more)
{
    size_t start = scan->next;
    size_t end = start;
    const char *name;
    size_t name_length;
    char *text;
    bs_field *field;
    bool ended = false;
    bs_status st;

    find_name(scan, &name, &name_length);
    while ((*more = bs_scan__line(scan))) {
        bool blank = is_blank(scan);

        if (ended && scan->size > 0 && scan->at[0] == '>')
            break;
        ended = blank;
        if (!blank)
            end = (size_t)(scan->at - scan->text) + scan->size;
    }
    if ((st = add_field(f, &field)) != BS_OK ||
        (st = bs_utf8__copy(f->cx, f->home, name, name_length, &text, &field->name_length)) !=
            BS_OK)
        return st;
    field->name = text;
    st =
        bs_utf8__copy(f->cx, f->home, scan->text + start, end - start, &text, &field->value_length);
    if (st != BS_OK)
        return st;
    field->value = text;
    field->value_length = join_lines(text, field->value_length);
    return BS_OK;
}

static bs_status read_fields(fields *f, bs_scan *scan)
{
    bool more = bs_scan__line(scan);
    bs_status st = BS_OK;

    while (more && st == BS_OK) {
        if (is_blank(scan))
            more = bs_scan__line(scan);
        else if (scan->at[0] == '>')
            st = read_field(f, scan, &more);
        else
            return bs_scan__fail(scan, BS_ESYNTAX, 0, 0,
                                 "a data field such as > <NAME> or $$$$ was "
                                 "expected");
    }
    return st;
}

bs_status bs_sdf__read(bs_ctx *cx, bs_arena *home, const char *text, size_t length, long first_line,
                       bs_record *out)
{
    bs_mark temp = bs_arena_mark(&cx->scratch);
    bs_molfile file = {.cx = cx, .temp = &cx->scratch};
    fields f = {.cx = cx, .home = home};
    bs_scan scan;
    bs_status st;

    bs_scan__begin(&scan, cx, text, length, first_line);
    if ((st = bs_molfile__read(&file, &scan)) != BS_OK ||
        (st = bs_molfile__build(&file, home, out)) != BS_OK ||
        (st = read_fields(&f, &scan)) != BS_OK)
        goto done;
    out->fields = f.list;
    out->field_count = f.count;
done:
    if (home != &cx->scratch)
        bs_arena_rewind(&cx->scratch, temp);
    return st;
}
