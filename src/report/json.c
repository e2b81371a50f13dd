/* The writer of json.h. */
#include "report/json.h"

#include <math.h>
#include <stdio.h>
#include <stdlib.h>
#include <string.h>

static void put(bs_json *json, const char *string)
{
    if (json->status == BS_OK)
        json->status = bs_text_puts(json->text, string);
}

static void put_byte(bs_json *json, char c)
{
    if (json->status == BS_OK)
        json->status = bs_text_putc(json->text, c);
}

static void break_line(bs_json *json)
{
    if (json->line)
        return;
    put_byte(json, '\n');
    for (int i = 0; i < json->depth; i++)
        put(json, "  ");
}

/* What stands before a key or an entry of a list. */
static void separate(bs_json *json)
{
    if (json->begun)
        put(json, json->line ? ", " : ",");
    if (json->depth > 0)
        break_line(json);
    json->begun = true;
}

/* A value that follows its key needs no separator. */
static void before_value(bs_json *json)
{
    size_t length = json->text->length;

    if (length < 2 || memcmp(json->text->data + length - 2, ": ", 2) != 0)
        separate(json);
}

void bs_json__open(bs_json *json, char bracket)
{
    before_value(json);
    put_byte(json, bracket);
    json->depth++;
    json->begun = false;
}

void bs_json__open_line(bs_json *json, char bracket)
{
    bs_json__open(json, bracket);
    if (json->line == 0)
        json->line = json->depth;
}

void bs_json__close(bs_json *json, char bracket)
{
    bool ends = json->line == json->depth;

    json->depth--;
    if (json->begun)
        break_line(json);
    if (ends)
        json->line = 0;
    put_byte(json, bracket);
    json->begun = true;
}

/* Length of the UTF-8 sequence at `at`, or 0 if it is none. */
static int sequence_length(const unsigned char *at)
{
    static const unsigned char least[] = {0, 0, 0xC2, 0xE0, 0xF0};
    int length = at[0] < 0x80 ? 1 : at[0] < 0xE0 ? 2 : at[0] < 0xF0 ? 3 : at[0] < 0xF5 ? 4 : 0;

    if (length == 0 || at[0] < least[length])
        return 0;
    for (int i = 1; i < length; i++) {
        if ((at[i] & 0xC0) != 0x80)
            return 0;
    }
    if ((at[0] == 0xE0 && at[1] < 0xA0) || (at[0] == 0xED && at[1] > 0x9F) ||
        (at[0] == 0xF0 && at[1] < 0x90) || (at[0] == 0xF4 && at[1] > 0x8F))
        return 0;
    return length;
}

static void put_string(bs_json *json, const char *string)
{
    const unsigned char *at = (const unsigned char *)string;

    put_byte(json, '"');
    while (*at && json->status == BS_OK) {
        int length = sequence_length(at);

        if (*at == '"' || *at == '\\') {
            put_byte(json, '\\');
            put_byte(json, (char)*at);
        } else if (*at < 32 || *at == 127) {
            json->status = bs_text_printf(json->text, "\\u%04x", *at);
        } else if (length == 0) {
            put(json, "\\ufffd");
            length = 1;
        } else {
            json->status = bs_text_add(json->text, (const char *)at, (size_t)length);
        }
        at += length > 0 ? length : 1;
    }
    put_byte(json, '"');
}

void bs_json__key(bs_json *json, const char *key)
{
    separate(json);
    put_string(json, key);
    put(json, ": ");
}

void bs_json__string(bs_json *json, const char *string)
{
    before_value(json);
    if (string)
        put_string(json, string);
    else
        put(json, "null");
}

void bs_json__number(bs_json *json, double number)
{
    char digits[40];

    before_value(json);
    if (!isfinite(number)) {
        put(json, "null");
        return;
    }
    for (int precision = 15; precision <= 17; precision++) {
        snprintf(digits, sizeof digits, "%.*g", precision, number);
        if (strtod(digits, NULL) == number)
            break;
    }
    put(json, digits);
}

void bs_json__flag(bs_json *json, bool flag)
{
    before_value(json);
    put(json, flag ? "true" : "false");
}

void bs_json__string_field(bs_json *json, const char *key, const char *string)
{
    if (!string)
        return;
    bs_json__key(json, key);
    bs_json__string(json, string);
}

void bs_json__number_field(bs_json *json, const char *key, double number)
{
    bs_json__key(json, key);
    bs_json__number(json, number);
}

void bs_json__flag_field(bs_json *json, const char *key, bool flag)
{
    bs_json__key(json, key);
    bs_json__flag(json, flag);
}

void bs_json__strings_field(bs_json *json, const char *key, const char *const *items, int count)
{
    if (count <= 0)
        return;
    bs_json__key(json, key);
    bs_json__open_line(json, '[');
    for (int i = 0; i < count; i++)
        bs_json__string(json, items[i]);
    bs_json__close(json, ']');
}
