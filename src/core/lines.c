/*
 * The line reader of lines.h, on top of zlib's stream of plain or gzip bytes.
 *
 * A line that lies in one block is handed out where it stands; only a line across two blocks is
 * copied. zlib keeps its own window of some 100 KB; all else goes through the gate.
 */
#include "core/lines.h"

#include <errno.h>
#include <fcntl.h>
#include <string.h>
#include <sys/stat.h>
#include <unistd.h>
#include <zlib.h>

enum {
    BLOCK = 1 << 16,
    /* Chemical files shrink ten- to thirtyfold; thousandfold is a gzip file made to do harm. */
    MOST_EXPANSION = 250
};

#define EXPANSION_COUNTS_FROM ((uint64_t)64 << 20)

struct bs_lines {
    bs_ctx *cx;
    gzFile file;
    char *path;
    size_t longest;
    uint64_t total; /* bytes after expansion */
    size_t at, filled;
    long number;
    bool ended;    /* the last byte of the file is in the block */
    bool skipping; /* the rest of a line that was too long comes next */
    bool can_go_on;
    bs_text line; /* a line across blocks */
    char block[BLOCK];
};

static bs_status open_gzip(bs_lines *lines, const char *path)
{
    struct stat info;
    int fd = open(path, O_RDONLY | O_NONBLOCK | O_CLOEXEC);

    if (fd < 0)
        return bs_fail(lines->cx, BS_EFILE, "cannot open '%.200s': %s", path, strerror(errno));
    if (fstat(fd, &info) != 0 || !S_ISREG(info.st_mode)) {
        close(fd);
        return bs_fail(lines->cx, BS_EFILE, "'%.200s' is not a regular file", path);
    }
    lines->file = gzdopen(fd, "rb");
    if (!lines->file) {
        close(fd);
        return bs_fail_memory(lines->cx);
    }
    gzbuffer(lines->file, BLOCK);
    return BS_OK;
}

bs_status bs_lines_open(bs_ctx *cx, const char *path, size_t longest, bs_lines **out)
{
    bs_lines *lines = bs_gate_alloc(cx->gate, sizeof *lines);
    size_t size = strlen(path) + 1;
    bs_status st;

    *out = NULL;
    if (!lines)
        return bs_fail_memory(cx);
    lines->cx = cx;
    lines->longest = longest;
    bs_text_init(&lines->line, cx);
    lines->path = bs_gate_alloc(cx->gate, size);
    if (!lines->path) {
        bs_gate_free(cx->gate, lines, sizeof *lines);
        return bs_fail_memory(cx);
    }
    memcpy(lines->path, path, size);
    if ((st = open_gzip(lines, path)) != BS_OK) {
        bs_lines_close(lines);
        return st;
    }
    *out = lines;
    return BS_OK;
}

void bs_lines_close(bs_lines *lines)
{
    bs_gate *gate;

    if (!lines)
        return;
    gate = lines->cx->gate;
    if (lines->file)
        gzclose(lines->file);
    bs_text_free(&lines->line);
    bs_gate_free(gate, lines->path, strlen(lines->path) + 1);
    bs_gate_free(gate, lines, sizeof *lines);
}

long bs_lines_number(const bs_lines *lines)
{
    return lines->number;
}

bool bs_lines_can_go_on(const bs_lines *lines)
{
    return lines->can_go_on;
}

static bs_status check_expansion(bs_lines *lines)
{
    z_off_t packed = gzoffset(lines->file);

    if (lines->total < EXPANSION_COUNTS_FROM || packed <= 0 ||
        lines->total / MOST_EXPANSION < (uint64_t)packed)
        return BS_OK;
    return bs_fail(lines->cx, BS_ELIMIT,
                   "'%.200s' expands to more than %d times its size; it was "
                   "not read on",
                   lines->path, MOST_EXPANSION);
}

/* Fills the empty block. */
static bs_status refill(bs_lines *lines)
{
    int n = gzread(lines->file, lines->block, BLOCK);
    int code = Z_OK;
    const char *text = gzerror(lines->file, &code);

    lines->at = lines->filled = 0;
    if (n < 0 && code == Z_ERRNO)
        return bs_fail(lines->cx, BS_EFILE, "cannot read '%.200s': %s", lines->path,
                       strerror(errno));
    if (n < 0 && code == Z_MEM_ERROR)
        return bs_fail_memory(lines->cx);
    if (code == Z_BUF_ERROR)
        return bs_fail(lines->cx, BS_EFILE, "'%.200s' is cut short: its gzip data have no end",
                       lines->path);
    if (n < 0)
        return bs_fail(lines->cx, BS_EFILE, "the gzip data of '%.200s' are damaged: %.100s",
                       lines->path, text);
    lines->filled = (size_t)n;
    lines->ended = n == 0;
    if (lines->total == 0 && n >= 3 && memcmp(lines->block, "\xEF\xBB\xBF", 3) == 0)
        lines->at = 3;
    lines->total += (uint64_t)n;
    return check_expansion(lines);
}

/*
 * Takes what the block has of the current line. *whole tells whether its end was met; then *text
 * is the part in the block, behind what `line` holds.
 */
static bool take(bs_lines *lines, const char **text, size_t *length)
{
    const char *start = lines->block + lines->at;
    size_t left = lines->filled - lines->at;
    const char *end = left ? memchr(start, '\n', left) : NULL;

    *text = start;
    *length = end ? (size_t)(end - start) : left;
    lines->at += *length + (end ? 1 : 0);
    return end != NULL;
}

static bs_status too_long(bs_lines *lines, bool whole)
{
    bs_status st = bs_fail(lines->cx, BS_ELIMIT, "line %ld is longer than %zu bytes", lines->number,
                           lines->longest);

    lines->cx->error.line = lines->number;
    lines->skipping = !whole;
    lines->can_go_on = true;
    return st;
}

/* Goes behind the rest of a line that was refused. */
static bs_status skip_rest(bs_lines *lines)
{
    const char *text;
    size_t length;
    bs_status st;

    while (!lines->ended && !take(lines, &text, &length)) {
        if ((st = bs_poll(lines->cx)) != BS_OK || (st = refill(lines)) != BS_OK)
            return st;
    }
    lines->skipping = false;
    return BS_OK;
}

static void hand_out(const char *from, size_t size, const char **text, size_t *length)
{
    *text = from;
    *length = size > 0 && from[size - 1] == '\r' ? size - 1 : size;
}

/* Goes on with a line that the block does not hold whole; `line` has what came so far. */
static bs_status gather(bs_lines *lines, const char **text, size_t *length)
{
    bool whole = false;
    const char *part;
    size_t size;
    bs_status st;

    while (!whole && !lines->ended) {
        if ((st = bs_poll(lines->cx)) != BS_OK || (st = refill(lines)) != BS_OK)
            return st;
        whole = take(lines, &part, &size);
        if (lines->line.length + size > lines->longest)
            return too_long(lines, whole);
        if ((st = bs_text_add(&lines->line, part, size)) != BS_OK)
            return st;
    }
    if (lines->line.length == 0 && !whole) {
        *text = NULL;
        *length = 0;
        lines->number--;
        return BS_OK;
    }
    hand_out(lines->line.data, lines->line.length, text, length);
    return BS_OK;
}

bs_status bs_lines_next(bs_lines *lines, const char **text, size_t *length)
{
    const char *part;
    size_t size;
    bool whole;
    bs_status st;

    lines->can_go_on = false;
    *text = NULL;
    *length = 0;
    if (lines->skipping && (st = skip_rest(lines)) != BS_OK)
        return st;
    bs_text_clear(&lines->line);
    lines->number++;
    whole = take(lines, &part, &size);
    if (size > lines->longest)
        return too_long(lines, whole);
    if (whole) {
        hand_out(part, size, text, length);
        return BS_OK;
    }
    if ((st = bs_text_add(&lines->line, part, size)) != BS_OK)
        return st;
    return gather(lines, text, length);
}
