/* Statuses, the error value and the context. */
#include "backsaw/core.h"

#include <stdarg.h>
#include <stdio.h>
#include <string.h>

const char *bs_status_text(bs_status status)
{
    switch (status) {
#define X(code, text)                                                                              \
    case code:                                                                                     \
        return text;
        BS_STATUS_LIST(X)
#undef X
    }
    return "unknown status";
}

void bs_ctx_init(bs_ctx *cx, bs_gate *gate)
{
    memset(cx, 0, sizeof *cx);
    atomic_init(&cx->own_gate.used, 0);
    atomic_init(&cx->own_gate.fail_after, -1);
    atomic_init(&cx->own_stop, false);
    cx->gate = gate ? gate : &cx->own_gate;
    cx->stop = &cx->own_stop;
    cx->error.offset = -1;
    bs_arena_init(&cx->scratch, cx->gate);
}

void bs_ctx_free(bs_ctx *cx)
{
    bs_arena_free(&cx->scratch);
}

/* A message is one line of printable text, whatever the input that it quotes. */
static void add_escaped(char *out, size_t size, const char *text)
{
    size_t used = 0;

    for (; *text; text++) {
        unsigned char c = (unsigned char)*text;
        bool plain = c >= 32 && c != 127;

        if (used + (plain ? 2 : 5) > size)
            break;
        if (plain)
            out[used++] = (char)c;
        else
            used += (size_t)snprintf(out + used, size - used, "\\x%02X", c);
    }
    out[used] = '\0';
}

static void set_error(bs_ctx *cx, bs_status code, long offset, const char *format, va_list args)
{
    char raw[BS_MESSAGE_MAX];

    vsnprintf(raw, sizeof raw, format, args);
    cx->error.code = code;
    cx->error.offset = offset;
    cx->error.line = 0;
    add_escaped(cx->error.message, sizeof cx->error.message, raw);
}

bs_status (bs_fail)(bs_ctx *cx, bs_status code, const char *format, ...)
{
    va_list args;

    va_start(args, format);
    set_error(cx, code, -1, format, args);
    va_end(args);
    return code;
}

bs_status (bs_fail_at)(bs_ctx *cx, bs_status code, size_t offset, const char *format, ...)
{
    va_list args;

    va_start(args, format);
    set_error(cx, code, (long)offset, format, args);
    va_end(args);
    return code;
}

bs_status (bs_fail_memory)(bs_ctx *cx)
{
    return bs_fail(cx, BS_ENOMEM, "out of memory");
}

bs_status bs_poll(bs_ctx *cx)
{
    if (atomic_load_explicit(cx->stop, memory_order_relaxed))
        return bs_fail(cx, BS_ESTOPPED, "stopped");
    if (cx->budget && *cx->budget < 0)
        return bs_fail(cx, BS_ELIMIT, "the limit of work is reached");
    return BS_OK;
}

#define CARET_WIDTH 72

void bs_error_caret(const bs_error *error, const char *text, size_t length, char *out, size_t size)
{
    size_t at, start, end, used = 0;

    if (size == 0)
        return;
    out[0] = '\0';
    if (error->offset < 0 || (size_t)error->offset > length || size < 2 * CARET_WIDTH + 8)
        return;
    at = (size_t)error->offset;
    for (start = at; start > 0 && text[start - 1] != '\n'; start--)
        ;
    if (at - start > CARET_WIDTH / 2)
        start = at - CARET_WIDTH / 2;
    for (end = at; end < length && text[end] != '\n' && end - start < CARET_WIDTH; end++)
        ;
    out[used++] = ' ';
    out[used++] = ' ';
    for (size_t i = start; i < end; i++) {
        unsigned char c = (unsigned char)text[i];
        out[used++] = c >= 32 && c < 127 ? (char)c : '?';
    }
    out[used++] = '\n';
    for (size_t i = start; i < at + 2; i++)
        out[used++] = ' ';
    out[used++] = '^';
    out[used] = '\0';
}
