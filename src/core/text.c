/* The growing text buffer. */
#include "backsaw/core.h"

#include <stdarg.h>
#include <stdio.h>
#include <string.h>

void bs_text_init(bs_text *text, bs_ctx *cx)
{
    *text = (bs_text){.cx = cx};
}

void bs_text_free(bs_text *text)
{
    bs_gate_free(text->cx->gate, text->data, text->room);
    bs_text_init(text, text->cx);
}

void bs_text_clear(bs_text *text)
{
    text->length = 0;
    if (text->data)
        text->data[0] = '\0';
}

/* Makes room for `extra` bytes and a NUL. */
static bs_status grow(bs_text *text, size_t extra)
{
    size_t room = text->room ? text->room : 64;
    char *data;

    if (extra >= SIZE_MAX / 4 - text->length)
        return bs_fail_memory(text->cx);
    while (room < text->length + extra + 1)
        room *= 2;
    if (room == text->room)
        return BS_OK;
    data = bs_gate_resize(text->cx->gate, text->data, text->room, room);
    if (!data)
        return bs_fail_memory(text->cx);
    text->data = data;
    text->room = room;
    return BS_OK;
}

bs_status bs_text_add(bs_text *text, const char *bytes, size_t length)
{
    bs_status st = grow(text, length);

    if (st != BS_OK)
        return st;
    if (length > 0)
        memcpy(text->data + text->length, bytes, length);
    text->length += length;
    text->data[text->length] = '\0';
    return BS_OK;
}

bs_status bs_text_puts(bs_text *text, const char *string)
{
    return bs_text_add(text, string, strlen(string));
}

bs_status bs_text_putc(bs_text *text, char c)
{
    return bs_text_add(text, &c, 1);
}

bs_status bs_text_printf(bs_text *text, const char *format, ...)
{
    va_list args;
    int needed;
    bs_status st;

    va_start(args, format);
    needed = vsnprintf(NULL, 0, format, args);
    va_end(args);
    if (needed < 0)
        return bs_fail(text->cx, BS_EBUG, "text cannot be formatted");
    if ((st = grow(text, (size_t)needed)) != BS_OK)
        return st;
    va_start(args, format);
    vsnprintf(text->data + text->length, (size_t)needed + 1, format, args);
    va_end(args);
    text->length += (size_t)needed;
    return BS_OK;
}
