/* Files of molecules, record by record. */
#include "backsaw/file.h"

#include "backsaw/format.h"
#include "core/lines.h"
#include "format/kind.h"
#include "format/sdf.h"
#include "format/utf8.h"

#include <string.h>

#define LINE_LIMIT ((size_t)1 << 20)
#define RECORD_LIMIT ((size_t)64 << 20)

struct bs_file {
    bs_ctx *cx;
    bs_lines *lines;
    bs_file_kind kind;
    size_t record_limit;
    bs_text text; /* of the SD record in hand */
    long number;  /* of the record */
    long line;    /* where it begins */
    bool ended;
    bool skipping; /* the rest of a record that was too long comes next */
    bool can_go_on;
};

/* ---- Opening ------------------------------------------------------------------------------- */

static char lower(char c)
{
    return c >= 'A' && c <= 'Z' ? (char)(c - 'A' + 'a') : c;
}

/* Whether `name` without its last `cut` bytes ends in `ending`, in either case. */
static bool has_ending(const char *name, size_t cut, const char *ending)
{
    size_t length = strlen(name) - cut;
    size_t size = strlen(ending);

    if (length <= size)
        return false;
    for (size_t i = 0; i < size; i++) {
        if (lower(name[length - size + i]) != ending[i])
            return false;
    }
    return true;
}

bool bs_file__is_gzip(const char *path)
{
    return has_ending(path, 0, ".gz");
}

bs_file_kind bs_file__kind(const char *path)
{
    static const struct {
        const char *ending;
        bs_file_kind kind;
    } endings[] = {
        {".sdf", BS_FILE_SDF},    {".sd", BS_FILE_SDF},     {".mol", BS_FILE_SDF},
        {".mdl", BS_FILE_SDF},    {".smi", BS_FILE_SMILES}, {".smiles", BS_FILE_SMILES},
        {".ism", BS_FILE_SMILES}, {".txt", BS_FILE_SMILES},
    };
    size_t cut = has_ending(path, 0, ".gz") ? 3 : 0;

    for (size_t i = 0; i < sizeof endings / sizeof *endings; i++) {
        if (has_ending(path, cut, endings[i].ending))
            return endings[i].kind;
    }
    return BS_FILE_BY_NAME;
}

bs_status bs_file_open(bs_ctx *cx, const char *path, const bs_file_options *options, bs_file **out)
{
    static const bs_file_options usual;
    const bs_file_options *o = options ? options : &usual;
    bs_file_kind kind = o->kind == BS_FILE_BY_NAME ? bs_file__kind(path) : o->kind;
    bs_file *file;
    bs_status st;

    *out = NULL;
    if (kind == BS_FILE_BY_NAME)
        return bs_fail(cx, BS_EVALUE,
                       "the name '%.200s' does not tell what is in the file; .sdf, "
                       ".mol or .smi was expected, or one of them with .gz",
                       path);
    file = bs_gate_alloc(cx->gate, sizeof *file);
    if (!file)
        return bs_fail_memory(cx);
    file->cx = cx;
    file->kind = kind;
    file->record_limit = o->record_limit ? o->record_limit : RECORD_LIMIT;
    bs_text_init(&file->text, cx);
    st = bs_lines_open(cx, path, o->line_limit ? o->line_limit : LINE_LIMIT, &file->lines);
    if (st != BS_OK) {
        bs_file_close(file);
        return st;
    }
    *out = file;
    return BS_OK;
}

void bs_file_close(bs_file *file)
{
    if (!file)
        return;
    bs_lines_close(file->lines);
    bs_text_free(&file->text);
    bs_gate_free(file->cx->gate, file, sizeof *file);
}

long bs_file_record_number(const bs_file *file)
{
    return file->number;
}

long bs_file_record_line(const bs_file *file)
{
    return file->line;
}

bool bs_file_can_go_on(const bs_file *file)
{
    return file->can_go_on;
}

/* ---- SD files ------------------------------------------------------------------------------ */

static bool is_end_of_record(const char *text, size_t length)
{
    return length >= 4 && memcmp(text, "$$$$", 4) == 0;
}

/* Goes behind the end of the record in hand. */
static bs_status skip_record(bs_file *file)
{
    const char *text;
    size_t length;
    bs_status st;

    for (;;) {
        st = bs_lines_next(file->lines, &text, &length);
        if (st == BS_ELIMIT && bs_lines_can_go_on(file->lines))
            continue;
        if (st != BS_OK || (st = bs_poll(file->cx)) != BS_OK)
            return st;
        file->ended = !text;
        if (!text || is_end_of_record(text, length))
            break;
    }
    file->skipping = false;
    return BS_OK;
}

/* Reads the lines of the next record; *any tells whether there is more than blank lines. */
static bs_status gather_record(bs_file *file, bool *any)
{
    const char *text;
    size_t length;
    bs_status st;

    *any = false;
    bs_text_clear(&file->text);
    file->line = bs_lines_number(file->lines) + 1;
    for (;;) {
        if ((st = bs_lines_next(file->lines, &text, &length)) != BS_OK) {
            file->skipping = file->can_go_on = bs_lines_can_go_on(file->lines);
            return st;
        }
        file->ended = !text;
        if (!text)
            return BS_OK;
        if (is_end_of_record(text, length)) {
            *any = true;
            return BS_OK;
        }
        for (size_t i = 0; i < length && !*any; i++)
            *any = text[i] != ' ' && text[i] != '\t';
        if (file->text.length + length + 1 > file->record_limit) {
            file->skipping = file->can_go_on = true;
            st = bs_fail(file->cx, BS_ELIMIT, "line %ld: the record is longer than %zu bytes",
                         bs_lines_number(file->lines), file->record_limit);
            file->cx->error.line = bs_lines_number(file->lines);
            return st;
        }
        if ((st = bs_text_add(&file->text, text, length)) != BS_OK ||
            (st = bs_text_putc(&file->text, '\n')) != BS_OK)
            return st;
    }
}

static bs_status next_sdf(bs_file *file, bs_arena *home, bs_record **out)
{
    bs_record *record;
    bool any;
    bs_status st;

    if (file->skipping && (st = skip_record(file)) != BS_OK)
        return st;
    if (file->ended)
        return BS_OK;
    file->number++;
    if ((st = gather_record(file, &any)) != BS_OK)
        return st;
    if (!any && file->ended) {
        file->number--;
        return BS_OK;
    }
    file->can_go_on = true;
    if ((st = bs_new(file->cx, home, 1, &record)) != BS_OK ||
        (st = bs_sdf__read(file->cx, home, file->text.data ? file->text.data : "",
                           file->text.length, file->line, record)) != BS_OK)
        return st;
    *out = record;
    return BS_OK;
}

/* ---- SMILES files -------------------------------------------------------------------------- */

static bool is_space(char c)
{
    return c == ' ' || c == '\t';
}

/* A first line that names its columns. */
static bool is_heading(const char *text, size_t length)
{
    static const char word[] = "smiles";

    for (size_t i = 0; i < sizeof word - 1; i++) {
        if (i >= length || lower(text[i]) != word[i])
            return false;
    }
    return length == sizeof word - 1 || is_space(text[sizeof word - 1]);
}

/* The name behind a SMILES; extensions between bars are left out. */
static bs_status take_name(bs_file *file, bs_arena *home, const char *text, size_t length,
                           bs_record *record)
{
    char *name;
    bs_status st;

    while (length > 0 && is_space(*text)) {
        text++;
        length--;
    }
    if (length > 1 && *text == '|') {
        const char *end = memchr(text + 1, '|', length - 1);

        if (end) {
            length -= (size_t)(end + 1 - text);
            text = end + 1;
        }
    }
    while (length > 0 && is_space(*text)) {
        text++;
        length--;
    }
    while (length > 0 && is_space(text[length - 1]))
        length--;
    st = bs_utf8__copy(file->cx, home, text, length, &name, &record->name_length);
    record->name = st == BS_OK ? name : NULL;
    return st;
}

static bs_status read_smiles(bs_file *file, bs_arena *home, const char *text, size_t length,
                             bs_record **out)
{
    bs_ctx *cx = file->cx;
    size_t start = 0;
    size_t used;
    bs_record *record;
    bs_mol *mol;
    bs_status st;

    while (start < length && is_space(text[start]))
        start++;
    if ((st = bs_new(cx, home, 1, &record)) != BS_OK)
        return st;
    st = bs_smiles_read(cx, home, text + start, length - start, &used, &mol);
    if (st != BS_OK) {
        char message[BS_MESSAGE_MAX];

        memcpy(message, cx->error.message, sizeof message);
        if (st != BS_ENOMEM && st != BS_ESTOPPED && cx->error.offset >= 0)
            bs_fail(cx, st, "line %ld, column %ld: %.300s", file->line,
                    (long)start + cx->error.offset + 1, message);
        cx->error.line = file->line;
        return st;
    }
    record->mol = mol;
    st = take_name(file, home, text + start + used, length - start - used, record);
    if (st == BS_OK)
        *out = record;
    return st;
}

static bs_status next_smiles(bs_file *file, bs_arena *home, bs_record **out)
{
    const char *text;
    size_t length;
    bs_status st;

    for (;;) {
        size_t start = 0;

        if (file->ended)
            return BS_OK;
        st = bs_lines_next(file->lines, &text, &length);
        file->line = bs_lines_number(file->lines);
        if (st != BS_OK) {
            file->number++;
            file->can_go_on = bs_lines_can_go_on(file->lines);
            return st;
        }
        file->ended = !text;
        if (!text || (st = bs_poll(file->cx)) != BS_OK)
            return st;
        while (start < length && is_space(text[start]))
            start++;
        if (start < length && text[start] != '#' && !(file->line == 1 && is_heading(text, length)))
            break;
    }
    file->number++;
    file->can_go_on = true;
    return read_smiles(file, home, text, length, out);
}

bs_status bs_file_next(bs_file *file, bs_arena *home, bs_record **out)
{
    bs_mark kept = bs_arena_mark(home);
    bs_status st;

    *out = NULL;
    file->can_go_on = false;
    st = file->kind == BS_FILE_SMILES ? next_smiles(file, home, out) : next_sdf(file, home, out);
    if (st == BS_OK) {
        if (*out) {
            (*out)->number = file->number;
            (*out)->line = file->line;
        }
        return BS_OK;
    }
    *out = NULL;
    bs_arena_rewind(home, kept);
    if (st == BS_ENOMEM || st == BS_ESTOPPED)
        file->can_go_on = false;
    /* The text of the record is not the caller's, so a place in it would say nothing. */
    file->cx->error.offset = -1;
    return st;
}
