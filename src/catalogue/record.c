/* The reader of lists: bytes to records. */
#include "catalogue/record.h"

#include <errno.h>
#include <fcntl.h>
#include <string.h>
#include <sys/stat.h>
#include <unistd.h>

/* ---- Bytes ----------------------------------------------------------------------------- */

/* Fills the empty buffer; at the end of the file `filled` is 0. */
static bs_status refill(bs_records *r)
{
    int n = gzread(r->file, r->buffer, (unsigned)sizeof r->buffer);
    int code = Z_OK;
    const char *text = gzerror(r->file, &code);

    r->at = r->filled = 0;
    if (n < 0 && code == Z_ERRNO)
        return bs_fail(r->cx, BS_EFILE, "cannot read '%.200s': %s", r->path, strerror(errno));
    if (code == Z_BUF_ERROR)
        return bs_fail(r->cx, BS_EFILE, "'%.200s' is cut short: its gzip data have no end",
                       r->path);
    if (n < 0)
        return bs_fail(r->cx, BS_EFILE, "the gzip data of '%.200s' are damaged: %.100s", r->path,
                       text);
    r->filled = (size_t)n;
    r->total += (uint64_t)n;
    if (r->total > BS_RECORD_FILE_BYTES)
        return bs_fail(r->cx, BS_ELIMIT, "'%.200s' holds more than %llu MiB of text; split it",
                       r->path, (unsigned long long)(BS_RECORD_FILE_BYTES >> 20));
    return bs_poll(r->cx);
}

/* The next byte, or -1 at the end of the file. */
static inline bs_status next_byte(bs_records *r, int *byte)
{
    bs_status st;

    if (r->at == r->filled && (st = refill(r)) != BS_OK)
        return st;
    *byte = r->filled ? r->buffer[r->at++] : -1;
    return BS_OK;
}

/* ---- Opening --------------------------------------------------------------------------- */

static bs_status open_file(bs_records *r)
{
    struct stat info;
    int fd = open(r->path, O_RDONLY | O_NONBLOCK | O_CLOEXEC);

    if (fd < 0)
        return bs_fail(r->cx, BS_EFILE, "cannot open '%.200s': %s", r->path, strerror(errno));
    if (fstat(fd, &info) != 0 || !S_ISREG(info.st_mode)) {
        close(fd);
        return bs_fail(r->cx, BS_EFILE, "'%.200s' is not a regular file", r->path);
    }
    r->file = gzdopen(fd, "rb");
    if (!r->file) {
        close(fd);
        return bs_fail_memory(r->cx);
    }
    gzbuffer(r->file, 128 * 1024);
    return BS_OK;
}

static bs_status skip_mark(bs_records *r)
{
    const unsigned char *b = r->buffer;

    if (r->filled >= 2 && ((b[0] == 0xFF && b[1] == 0xFE) || (b[0] == 0xFE && b[1] == 0xFF)))
        return bs_fail(r->cx, BS_EFILE, "'%.200s' is UTF-16 text; save it as UTF-8", r->path);
    if (r->filled >= 3 && memcmp(b, "\xEF\xBB\xBF", 3) == 0)
        r->at = 3;
    return BS_OK;
}

/* The separator of a quoted list, from its first line. */
static int find_separator(const bs_records *r)
{
    bool quoted = false, semicolon = false, tab = false;

    for (size_t i = r->at; i < r->filled; i++) {
        int c = r->buffer[i];

        if (c == '"')
            quoted = !quoted;
        else if (quoted)
            continue;
        else if (c == '\n' || c == '\r')
            break;
        else if (c == ',')
            return ',';
        semicolon |= c == ';';
        tab |= c == '\t';
    }
    return semicolon ? ';' : tab ? '\t' : ',';
}

bs_status bs_records__open(bs_ctx *cx, const char *path, int separator, bool quotes,
                           bs_records *out)
{
    bs_status st;

    memset(out, 0, sizeof *out);
    out->cx = cx;
    out->path = path;
    out->separator = separator;
    out->quotes = quotes;
    out->next_line = 1;
    bs_text_init(&out->text, cx);
    if ((st = open_file(out)) == BS_OK && (st = refill(out)) == BS_OK)
        st = skip_mark(out);
    if (st != BS_OK) {
        bs_records__close(out);
        return st;
    }
    if (quotes)
        out->separator = find_separator(out);
    return BS_OK;
}

void bs_records__close(bs_records *records)
{
    if (records->file)
        gzclose_r(records->file);
    records->file = NULL;
    if (records->cx)
        bs_text_free(&records->text);
}

/* ---- Records --------------------------------------------------------------------------- */

typedef enum place { AT_START, IN_PLAIN, IN_QUOTED, AFTER_QUOTE } place;

/* Where in a record the reader is. */
typedef struct scan {
    place where;
    size_t start; /* of the field's text */
    long quote_line;
    size_t quoted; /* bytes since the quote was opened */
} scan;

static bs_status take(bs_records *r, int byte)
{
    if (r->text.length >= BS_RECORD_BYTES) {
        r->fault = "longer than 1 MiB";
        return BS_OK;
    }
    return bs_text_putc(&r->text, (char)byte);
}

static void end_field(bs_records *r, scan *s)
{
    if (r->field_count < BS_RECORD_FIELDS)
        r->fields[r->field_count] = (bs_span){s->start, r->text.length - s->start};
    r->field_count++;
    s->start = r->text.length;
    s->where = AT_START;
}

static bs_status fail_quote(bs_records *r, long line, const char *reason)
{
    bs_fail(r->cx, BS_ESYNTAX, "'%.200s': the quote opened in line %ld is not closed %s", r->path,
            line, reason);
    r->cx->error.line = line;
    return BS_ESYNTAX;
}

/* Reads one byte, or the end of the file, inside quotes. */
static bs_status scan_quoted(bs_records *r, scan *s, int c)
{
    if (c < 0)
        return fail_quote(r, s->quote_line, "before the end of the file");
    if (++s->quoted > BS_RECORD_BYTES)
        return fail_quote(r, s->quote_line, "within 1 MiB");
    if (c == '"') {
        s->where = AFTER_QUOTE;
        return BS_OK;
    }
    r->next_line += c == '\n';
    return take(r, c);
}

/* Reads one byte outside quotes that does not end the line. */
static bs_status scan_open(bs_records *r, scan *s, int c)
{
    if (c == r->separator) {
        end_field(r, s);
        return BS_OK;
    }
    if (r->quotes && c == '"' && s->where == AT_START) {
        s->where = IN_QUOTED;
        s->quote_line = r->next_line;
        s->quoted = 0;
        return BS_OK;
    }
    if (s->where == AFTER_QUOTE) {
        /* A second quote stands for one; blanks behind the closing quote do no harm. */
        if (c == '"') {
            s->where = IN_QUOTED;
            return take(r, c);
        }
        if (c == ' ')
            return BS_OK;
        r->fault = "text between a closing quote and the next separator";
    }
    s->where = IN_PLAIN;
    return take(r, c);
}

/* Reads one record, blank or not. */
static bs_status read_record(bs_records *r, bool *more)
{
    scan s = {.where = AT_START};
    bool any = false;
    int c;
    bs_status st;

    bs_text_clear(&r->text);
    r->field_count = 0;
    r->fault = NULL;
    r->line = r->next_line;
    if ((st = next_byte(r, &c)) != BS_OK)
        return st;
    if (r->after_cr && c == '\n' && (st = next_byte(r, &c)) != BS_OK)
        return st;
    while (s.where == IN_QUOTED || (c >= 0 && c != '\n' && c != '\r')) {
        any = true;
        st = s.where == IN_QUOTED ? scan_quoted(r, &s, c) : scan_open(r, &s, c);
        if (st != BS_OK || (st = next_byte(r, &c)) != BS_OK)
            return st;
    }
    end_field(r, &s);
    r->after_cr = c == '\r';
    r->next_line += c >= 0;
    *more = any || c >= 0;
    return BS_OK;
}

static bool is_blank(const bs_records *r)
{
    if (r->field_count != 1 || r->fault)
        return false;
    for (size_t i = 0; i < r->text.length; i++) {
        if (r->text.data[i] != ' ' && r->text.data[i] != '\t')
            return false;
    }
    return true;
}

bs_status bs_records__next(bs_records *records, bool *more)
{
    bs_status st;

    do {
        if ((st = bs_poll(records->cx)) != BS_OK || (st = read_record(records, more)) != BS_OK)
            return st;
    } while (*more && is_blank(records));
    if (*more && !records->fault && records->text.length > 0 &&
        memchr(records->text.data, '\0', records->text.length))
        records->fault = "a NUL byte; this is no text";
    return BS_OK;
}
