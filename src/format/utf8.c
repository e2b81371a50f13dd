/* Checking for UTF-8 and turning Latin-1 into it. */
#include "format/utf8.h"

#include <string.h>

/* The number of bytes of the character that starts at `at`, 0 if it is none (RFC 3629). */
static size_t character(const unsigned char *at, size_t left)
{
    size_t size = at[0] < 0x80                     ? 1
                  : at[0] >= 0xC2 && at[0] <= 0xDF ? 2
                  : at[0] >= 0xE0 && at[0] <= 0xEF ? 3
                  : at[0] >= 0xF0 && at[0] <= 0xF4 ? 4
                                                   : 0;

    if (size == 0 || size > left)
        return 0;
    for (size_t i = 1; i < size; i++) {
        if ((at[i] & 0xC0) != 0x80)
            return 0;
    }
    /* Overlong forms, surrogates, and what lies beyond U+10FFFF. */
    if ((at[0] == 0xE0 && at[1] < 0xA0) || (at[0] == 0xED && at[1] > 0x9F) ||
        (at[0] == 0xF0 && at[1] < 0x90) || (at[0] == 0xF4 && at[1] > 0x8F))
        return 0;
    return size;
}

static bool is_utf8(const char *text, size_t length)
{
    for (size_t at = 0; at < length;) {
        size_t size = character((const unsigned char *)text + at, length - at);

        if (size == 0)
            return false;
        at += size;
    }
    return true;
}

bs_status bs_utf8__copy(bs_ctx *cx, bs_arena *home, const char *text, size_t length, char **out,
                        size_t *out_length)
{
    size_t high = 0;
    size_t used = 0;
    bs_status st;

    *out_length = length;
    if (is_utf8(text, length))
        return bs_copy_text(cx, home, text, length, out);
    for (size_t i = 0; i < length; i++)
        high += (unsigned char)text[i] >= 0x80;
    if ((st = bs_new(cx, home, length + high + 1, out)) != BS_OK)
        return st;
    for (size_t i = 0; i < length; i++) {
        unsigned char c = (unsigned char)text[i];

        if (c >= 0x80)
            (*out)[used++] = (char)(0xC0 | c >> 6);
        (*out)[used++] = (char)(c >= 0x80 ? 0x80 | (c & 0x3F) : c);
    }
    *out_length = used;
    return BS_OK;
}
