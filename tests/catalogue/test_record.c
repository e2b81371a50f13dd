/* Lists cut into records: quotes, line ends, gzip, hostile files. */
#include "catalogue/folder.h"

#include "catalogue/record.h"

/* Reads a whole list into one line of text: fields in <>, records apart by |, faults as !. */
static bs_status read_list(folder *d, const char *name, int separator, bool quotes, char *out,
                           size_t size)
{
    bs_ctx *cx = &d->f->cx;
    bs_records *r = calloc(1, sizeof *r);
    bool more = true;
    size_t used = 0;
    bs_status st;

    assert_non_null(r);
    out[0] = '\0';
    st = bs_records__open(cx, name, separator, quotes, r);
    while (st == BS_OK && (st = bs_records__next(r, &more)) == BS_OK && more) {
        used += (size_t)snprintf(out + used, size - used, "%s%ld%s", used ? "|" : "", r->line,
                                 r->fault ? "!" : "");
        for (int i = 0; i < r->field_count && !r->fault && used < size; i++)
            used += (size_t)snprintf(out + used, size - used, "<%.*s>", (int)r->fields[i].length,
                                     r->text.data + r->fields[i].at);
        assert_true(used < size);
    }
    bs_records__close(r);
    free(r);
    return st;
}

static void check_list(folder *d, const char *text, int separator, bool quotes, const char *want)
{
    char got[1000];

    check_ok(d->f, read_list(d, folder_puts(d, "list", text), separator, quotes, got, sizeof got));
    assert_string_equal(got, want);
}

/* The examples of RFC 4180, section 2, and what spreadsheets add. */
static void csv__quotes_as_in_the_standard(void **state)
{
    folder *d = *state;

    check_list(d, "aaa,bbb,ccc\r\nzzz,yyy,xxx\r\n", ',', true,
               "1<aaa><bbb><ccc>|2<zzz><yyy><xxx>");
    check_list(d, "\"aaa\",\"bbb\",\"ccc\"\r\nzzz,yyy,xxx", ',', true,
               "1<aaa><bbb><ccc>|2<zzz><yyy><xxx>");
    check_list(d, "\"aaa\",\"b\r\nbb\",\"ccc\"\r\nzzz,yyy,xxx", ',', true,
               "1<aaa><b\r\nbb><ccc>|3<zzz><yyy><xxx>");
    check_list(d, "\"aaa\",\"b\"\"bb\",\"ccc\"", ',', true, "1<aaa><b\"bb><ccc>");
    check_list(d, "\"\",,\"\"\"\"\n", ',', true, "1<><><\">");
    check_list(d, "2,2':6',2\"-terpyridine,x\n", ',', true, "1<2><2':6'><2\"-terpyridine><x>");
}

static void csv__separator_of_the_first_line(void **state)
{
    folder *d = *state;

    check_list(d, "smiles;name\nC;2,2-x\n", ',', true, "1<smiles><name>|2<C><2,2-x>");
    check_list(d, "smiles\tname\nC\tx;y\n", ',', true, "1<smiles><name>|2<C><x;y>");
    check_list(d, "\"a;b\",c;d\n", ',', true, "1<a;b><c;d>");
}

static void csv__text_behind_a_quote_is_a_fault(void **state)
{
    check_list(*state, "\"aaa\"b,c\n\"d\" ,e\n", ',', true, "1!|2<d><e>");
}

static void csv__open_quote_is_an_error(void **state)
{
    folder *d = *state;
    char got[100];
    const char *name = folder_puts(d, "list", "a,b\nc,\"d\ne,f\n");

    assert_int_equal(read_list(d, name, ',', true, got, sizeof got), BS_ESYNTAX);
    assert_int_equal(d->f->cx.error.line, 2);
    assert_non_null(strstr(d->f->cx.error.message, "the quote opened in line 2 is not closed"));
}

static void csv__quote_longer_than_a_record_is_an_error(void **state)
{
    folder *d = *state;
    size_t length = 3u << 20;
    char *text = malloc(length), got[100];

    assert_non_null(text);
    memset(text, '\n', length);
    memcpy(text, "a\n\"", 3);
    assert_int_equal(
        read_list(d, folder_write(d, "list", text, length), ',', true, got, sizeof got),
        BS_ESYNTAX);
    assert_int_equal(d->f->cx.error.line, 2);
    free(text);
}

static void lines__every_kind_of_end(void **state)
{
    folder *d = *state;

    check_list(d, "a\nb\r\nc\rd", -1, false, "1<a>|2<b>|3<c>|4<d>");
    check_list(d, "a\r\n\r\n \t\nb\n\n", -1, false, "1<a>|4<b>");
    check_list(d, "\r\ra\r", -1, false, "3<a>");
    check_list(d, "", -1, false, "");
    check_list(d, "\n\r\n", -1, false, "");
    check_list(d, "a\t\"b\tc\n\t\n", '\t', false, "1<a><\"b><c>|2<><>");
}

static void lines__mark_is_skipped(void **state)
{
    check_list(*state, "\xEF\xBB\xBFsmiles\tname\n", '\t', false, "1<smiles><name>");
}

static void lines__utf16_is_refused(void **state)
{
    folder *d = *state;
    char got[100];
    const char *name = folder_write(d, "list", "\xFF\xFEs\0m\0", 6);

    assert_int_equal(read_list(d, name, '\t', false, got, sizeof got), BS_EFILE);
    assert_non_null(strstr(d->f->cx.error.message, "UTF-16"));
}

static void lines__nul_is_a_fault(void **state)
{
    folder *d = *state;
    char got[100];
    const char *name = folder_write(d, "list", "C\0C\nCC\n\0", 8);

    check_ok(d->f, read_list(d, name, -1, false, got, sizeof got));
    assert_string_equal(got, "1!|2<CC>|3!");
}

/* 1 MiB is kept; one byte more, or several times more, is not. */
static void lines__long_ones_are_faults(void **state)
{
    static const size_t lengths[] = { BS_RECORD_BYTES, BS_RECORD_BYTES + 1, 5000000 };
    folder *d = *state;
    size_t room = 2, used = 0;
    char *text, *got = malloc(2 * BS_RECORD_BYTES);
    const char *name;

    for (int i = 0; i < 3; i++)
        room += lengths[i] + 1;
    text = malloc(room);
    assert_true(text && got);
    for (int i = 0; i < 3; i++) {
        memset(text + used, 'C', lengths[i]);
        used += lengths[i];
        text[used++] = '\n';
    }
    text[used++] = 'N';
    name = folder_write(d, "list", text, used);
    check_ok(d->f, read_list(d, name, -1, false, got, 2 * BS_RECORD_BYTES));
    assert_int_equal(strlen(got), strlen("1<>|2!|3!|4<N>") + BS_RECORD_BYTES);
    assert_string_equal(got + 2 + BS_RECORD_BYTES, ">|2!|3!|4<N>");
    free(text);
    free(got);
}

static void lines__many_fields_are_counted_only(void **state)
{
    folder *d = *state;
    char text[1001];
    bs_records *r = calloc(1, sizeof *r);
    bool more;

    assert_non_null(r);
    memset(text, '\t', 1000);
    text[1000] = '\0';
    check_ok(d->f, bs_records__open(&d->f->cx, folder_puts(d, "list", text), '\t', false, r));
    check_ok(d->f, bs_records__next(r, &more));
    assert_true(more);
    assert_int_equal(r->field_count, 1001);
    bs_records__close(r);
    free(r);
}

static void gzip__reads_as_plain_text(void **state)
{
    folder *d = *state;
    char got[100];

    check_ok(d->f, read_list(d, folder_puts(d, "list.gz", "a\nb\n"), -1, false, got, sizeof got));
    assert_string_equal(got, "1<a>|2<b>");
}

/* Makes a gzip file of text that hardly shrinks, cuts it at `cut` and spoils byte `spoil`. */
static const char *spoilt_gzip(folder *d, size_t cut, size_t spoil)
{
    char text[20000], *bytes;
    uint64_t seed = 1;
    size_t length;
    const char *name;
    FILE *out;

    for (size_t i = 0; i < sizeof text; i++) {
        seed = seed * 6364136223846793005u + 1442695040888963407u;
        text[i] = "CNOcno()=1\n"[(seed >> 33) % 11];
    }
    bytes = folder_slurp(folder_write(d, "whole.gz", text, sizeof text), &length);
    assert_true(length > 6000);
    bytes[spoil] = (char)(bytes[spoil] ^ (spoil ? 0x55 : 0));
    name = folder_name(d, "spoilt");
    out = fopen(name, "wb");
    assert_non_null(out);
    assert_int_equal(fwrite(bytes, 1, cut ? cut : length, out), cut ? cut : length);
    fclose(out);
    free(bytes);
    return name;
}

static void gzip__cut_or_damaged_is_an_error(void **state)
{
    folder *d = *state;
    size_t room = 1 << 20;
    char *got = malloc(room);

    assert_non_null(got);
    assert_int_equal(read_list(d, spoilt_gzip(d, 6000, 0), -1, false, got, room), BS_EFILE);
    assert_non_null(strstr(d->f->cx.error.message, "is cut short"));
    assert_int_equal(read_list(d, spoilt_gzip(d, 12, 0), -1, false, got, room), BS_EFILE);
    assert_int_equal(read_list(d, spoilt_gzip(d, 0, 5000), -1, false, got, room), BS_EFILE);
    assert_non_null(strstr(d->f->cx.error.message, "damaged"));
    check_ok(d->f, read_list(d, spoilt_gzip(d, 0, 0), -1, false, got, room));
    free(got);
}

static void open__what_is_no_file(void **state)
{
    folder *d = *state;
    char got[100];

    assert_int_equal(read_list(d, folder_name(d, "nothing"), -1, false, got, sizeof got), BS_EFILE);
    assert_non_null(strstr(d->f->cx.error.message, "No such file"));
    assert_int_equal(read_list(d, d->path, -1, false, got, sizeof got), BS_EFILE);
    assert_non_null(strstr(d->f->cx.error.message, "not a regular file"));
}

static void read__stops_when_asked(void **state)
{
    folder *d = *state;
    char got[100];

    atomic_store(d->f->cx.stop, true);
    assert_int_equal(read_list(d, folder_puts(d, "list", "a\n"), -1, false, got, sizeof got),
                     BS_ESTOPPED);
}

/* Numbers from 0 to `below` - 1, the same on every machine (Knuth's 64-bit LCG). */
static unsigned next_random(uint64_t *seed, unsigned below)
{
    *seed = *seed * 6364136223846793005u + 1442695040888963407u;
    return (unsigned)(*seed >> 33) % below;
}

/* Adds a random field as RFC 4180 writes it to `text`, and as read_list() shows it to `want`. */
static void add_field(uint64_t *seed, char *text, char *want)
{
    char field[16] = "", quoted[40] = "";
    unsigned length = next_random(seed, 8);

    for (unsigned i = 0; i < length; i++) {
        char c[2] = { "aC1,;\n\r\t\" "[next_random(seed, 10)], '\0' };

        strcat(field, c);
        strcat(quoted, *c == '"' ? "\"\"" : c);
    }
    sprintf(text + strlen(text), "\"%s\"", quoted);
    sprintf(want + strlen(want), "<%s>", field);
}

static void csv__what_is_written_is_read(void **state)
{
    folder *d = *state;
    uint64_t seed = 4180;

    for (int round = 0; round < 300; round++) {
        char text[2000] = "head,line\n", want[2000] = "1<head><line>|2";
        unsigned count = 2 + next_random(&seed, 20);

        for (unsigned i = 0; i < count; i++) {
            if (i > 0)
                strcat(text, ",");
            add_field(&seed, text, want);
        }
        strcat(text, round % 2 ? "\r\n" : "");
        check_list(d, text, ',', true, want);
    }
}

/* Whatever the bytes, the fields make up the text of the record and the lines count up. */
static void read__random_bytes_do_no_harm(void **state)
{
    folder *d = *state;
    bs_records *r = calloc(1, sizeof *r);
    uint64_t seed = 7;

    assert_non_null(r);
    for (int round = 0; round < 600; round++) {
        char bytes[300];
        unsigned length = next_random(&seed, sizeof bytes);
        long line = 0;
        bool more = true;

        for (unsigned i = 0; i < length; i++)
            bytes[i] = "aC1,;\n\r\t\"\0 \xEF\xBB\xBF"[next_random(&seed, 14)];
        check_ok(d->f, bs_records__open(&d->f->cx, folder_write(d, "list", bytes, length),
                                        round % 3 ? ',' : -1, round % 3 == 2, r));
        while (bs_records__next(r, &more) == BS_OK && more) {
            size_t sum = 0;

            assert_true(r->line > line);
            line = r->line;
            for (int i = 0; i < r->field_count && i < BS_RECORD_FIELDS; i++) {
                assert_int_equal(r->fields[i].at, sum);
                sum += r->fields[i].length;
            }
            assert_true(r->field_count > BS_RECORD_FIELDS || sum == r->text.length);
        }
        bs_records__close(r);
    }
    free(r);
}

int main(void)
{
    const struct CMUnitTest tests[] = {
        folder_case(csv__quotes_as_in_the_standard),
        folder_case(csv__what_is_written_is_read),
        folder_case(csv__separator_of_the_first_line),
        folder_case(csv__text_behind_a_quote_is_a_fault),
        folder_case(csv__open_quote_is_an_error),
        folder_case(csv__quote_longer_than_a_record_is_an_error),
        folder_case(lines__every_kind_of_end),
        folder_case(lines__mark_is_skipped),
        folder_case(lines__utf16_is_refused),
        folder_case(lines__nul_is_a_fault),
        folder_case(lines__long_ones_are_faults),
        folder_case(lines__many_fields_are_counted_only),
        folder_case(gzip__reads_as_plain_text),
        folder_case(gzip__cut_or_damaged_is_an_error),
        folder_case(open__what_is_no_file),
        folder_case(read__random_bytes_do_no_harm),
        folder_case(read__stops_when_asked),
    };

    return cmocka_run_group_tests(tests, NULL, NULL);
}
