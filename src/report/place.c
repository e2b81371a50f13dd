/* Finding a value in a JSON text that a parser has already taken. */
#include "report/place.h"

#include <string.h>

typedef struct scan {
    const char *at, *end;
} scan;

/* Goes on to what is neither blank nor comma nor colon. */
static void skip_blank(scan *s)
{
    while (s->at < s->end && strchr(" \t\r\n,:", *s->at) && *s->at)
        s->at++;
}

static void skip_string(scan *s)
{
    s->at++;
    while (s->at < s->end && *s->at != '"')
        s->at += *s->at == '\\' && s->at + 1 < s->end ? 2 : 1;
    if (s->at < s->end)
        s->at++;
}

/* Skips one value with all that is in it. */
static void skip_value(scan *s)
{
    int depth = 0;

    do {
        skip_blank(s);
        if (s->at >= s->end)
            return;
        if (*s->at == '"') {
            skip_string(s);
        } else if (*s->at == '{' || *s->at == '[') {
            depth++;
            s->at++;
        } else if (*s->at == '}' || *s->at == ']') {
            depth--;
            s->at++;
        } else {
            while (s->at < s->end && !strchr(" \t\r\n,:]}", *s->at))
                s->at++;
        }
    } while (depth > 0);
}

/* Whether the string at hand is this key; keys with escapes are none of ours. */
static bool is_key(const scan *s, const char *key)
{
    size_t length = strlen(key);

    return (size_t)(s->end - s->at) > length + 1 && memcmp(s->at + 1, key, length) == 0 &&
           s->at[length + 1] == '"';
}

/* Goes from the start of an object or list to a value in it; false if it is not there. */
static bool enter(scan *s, const bs_place_step *step)
{
    scan from = *s;

    if (s->at >= s->end || *s->at != (step->key ? '{' : '['))
        return false;
    s->at++;
    for (size_t i = 0;; i++) {
        bool here;

        skip_blank(s);
        if (s->at >= s->end || *s->at == '}' || *s->at == ']')
            break;
        here = step->key ? is_key(s, step->key) : i == step->index;
        if (step->key) {
            skip_string(s);
            skip_blank(s);
        }
        if (here)
            return true;
        skip_value(s);
    }
    *s = from;
    return false;
}

long bs_place__line(const char *text, size_t length, const bs_place_step *steps, int count)
{
    scan s = {text, text + length};
    long line = 1;

    skip_blank(&s);
    for (int i = 0; i < count && enter(&s, &steps[i]); i++)
        ;
    for (const char *at = text; at < s.at; at++)
        line += *at == '\n';
    return line;
}
