/* Lines, columns and numbers of molfiles, and the messages that name them. */
#include "format/molfile.h"

#include <math.h>
#include <stdarg.h>
#include <stdio.h>
#include <string.h>

void bs_scan__begin(bs_scan *scan, bs_ctx *cx, const char *text, size_t length, long first_line)
{
    *scan = (bs_scan){.cx = cx, .text = text, .length = length, .line = first_line - 1, .at = text};
}

bool bs_scan__line(bs_scan *scan)
{
    const char *end;

    if (scan->next >= scan->length)
        return false;
    scan->at = scan->text + scan->next;
    scan->size = scan->length - scan->next;
    end = memchr(scan->at, '\n', scan->size);
    if (end)
        scan->size = (size_t)(end - scan->at);
    scan->next += scan->size + (end ? 1 : 0);
    if (scan->size > 0 && scan->at[scan->size - 1] == '\r')
        scan->size--;
    scan->line++;
    return true;
}

bs_status bs_scan__need_line(bs_scan *scan, const char *what)
{
    bs_status st;

    if (bs_scan__line(scan))
        return BS_OK;
    st = bs_fail_at(scan->cx, BS_ESYNTAX, scan->length,
                    "line %ld: the record ends; %s was expected", scan->line + 1, what);
    scan->cx->error.line = scan->line + 1;
    return st;
}

bs_status bs_scan__fail(const bs_scan *scan, bs_status code, size_t column, size_t width,
                        const char *format, ...)
{
    char text[BS_MESSAGE_MAX];
    size_t offset = (size_t)(scan->at - scan->text) + column;
    va_list args;

    va_start(args, format);
    vsnprintf(text, sizeof text, format, args);
    va_end(args);
    if (width == 0)
        bs_fail_at(scan->cx, code, offset, "line %ld: %s", scan->line, text);
    else if (width == 1)
        bs_fail_at(scan->cx, code, offset, "line %ld, column %zu: %s", scan->line, column + 1,
                   text);
    else
        bs_fail_at(scan->cx, code, offset, "line %ld, columns %zu to %zu: %s", scan->line,
                   column + 1, column + width, text);
    scan->cx->error.line = scan->line;
    return code;
}

bs_status bs_scan__fail_line(bs_ctx *cx, long line, bs_status code, const char *format, ...)
{
    char text[BS_MESSAGE_MAX];
    va_list args;

    va_start(args, format);
    vsnprintf(text, sizeof text, format, args);
    va_end(args);
    bs_fail(cx, code, "line %ld: %s", line, text);
    cx->error.line = line;
    return code;
}

bool bs_scan__starts(const bs_scan *scan, const char *text)
{
    size_t length = strlen(text);

    return scan->size >= length && memcmp(scan->at, text, length) == 0;
}

bool bs_scan__long(const char *text, size_t length, long low, long high, long *out)
{
    size_t at = 0;
    bool negative = false;
    long value = 0;

    if (at < length && (text[at] == '-' || text[at] == '+'))
        negative = text[at++] == '-';
    if (at == length || length - at > 12)
        return false;
    for (; at < length; at++) {
        if (text[at] < '0' || text[at] > '9')
            return false;
        value = value * 10 + (text[at] - '0');
    }
    *out = negative ? -value : value;
    return *out >= low && *out <= high;
}

/* Digits from *at on; returns how many there were, at most 17 of which count. */
static int digits(const char *text, size_t length, size_t *at, double *value, int *scale, int step)
{
    int count = 0;

    for (; *at < length && text[*at] >= '0' && text[*at] <= '9'; ++*at) {
        if (count++ < 17 || step == 0) {
            *value = *value * 10 + (text[*at] - '0');
            *scale -= step;
        }
    }
    return count;
}

bool bs_scan__double(const char *text, size_t length, double *out)
{
    size_t at = 0;
    bool negative = false;
    double value = 0;
    int scale = 0;
    int count;
    long exponent = 0;

    if (length > 64)
        return false;
    if (at < length && (text[at] == '-' || text[at] == '+'))
        negative = text[at++] == '-';
    count = digits(text, length, &at, &value, &scale, 0);
    if (at < length && text[at] == '.') {
        at++;
        count += digits(text, length, &at, &value, &scale, 1);
    }
    if (count == 0)
        return false;
    if (at < length && (text[at] == 'e' || text[at] == 'E' || text[at] == 'd' || text[at] == 'D')) {
        if (!bs_scan__long(text + at + 1, length - at - 1, -300, 300, &exponent))
            return false;
        at = length;
    }
    value *= pow(10, scale + (double)exponent);
    *out = negative ? -value : value;
    return at == length && isfinite(value);
}

/* Cuts the blanks at both ends of a column; the column may reach over the end of the line. */
static void cut(const bs_scan *scan, size_t *column, size_t *width)
{
    size_t end = *column + *width;

    if (end > scan->size)
        end = scan->size;
    while (*column < end && scan->at[*column] == ' ')
        ++*column;
    while (end > *column && scan->at[end - 1] == ' ')
        end--;
    *width = end > *column ? end - *column : 0;
}

bs_status bs_scan__column(const bs_scan *scan, size_t column, size_t width, long low, long high,
                          const char *what, long *out)
{
    size_t start = column;
    size_t length = width;

    *out = 0;
    cut(scan, &start, &length);
    if (length == 0 || bs_scan__long(scan->at + start, length, low, high, out))
        return BS_OK;
    return bs_scan__fail(scan, BS_ESYNTAX, column, width,
                         "'%.*s' stands where %s (%ld to %ld) was "
                         "expected",
                         (int)length, scan->at + start, what, low, high);
}
