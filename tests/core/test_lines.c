/* Reading files line by line. */
#include "support/scratch.h"

#include "core/lines.h"

#define NAME "test_core_lines.tmp"

static bs_lines *open_text(fixture *f, const char *text, size_t length)
{
    bs_lines *lines;

    scratch_write(NAME, text, length);
    check_ok(f, bs_lines_open(&f->cx, NAME, 1000, &lines));
    return lines;
}

static void check_line(fixture *f, bs_lines *lines, const char *expected)
{
    const char *text;
    size_t length;

    check_ok(f, bs_lines_next(lines, &text, &length));
    if (!expected) {
        assert_null(text);
        return;
    }
    assert_non_null(text);
    assert_int_equal(length, strlen(expected));
    assert_memory_equal(text, expected, length);
}

static void lines__end_at_lf_or_crlf(void **state)
{
    fixture *f = *state;
    static const char text[] = "one\r\ntwo\n\nfour";
    bs_lines *lines = open_text(f, text, sizeof text - 1);

    check_line(f, lines, "one");
    check_line(f, lines, "two");
    check_line(f, lines, "");
    assert_int_equal(bs_lines_number(lines), 3);
    check_line(f, lines, "four");
    check_line(f, lines, NULL);
    check_line(f, lines, NULL);
    assert_int_equal(bs_lines_number(lines), 4);
    bs_lines_close(lines);
}

static void lines__of_an_empty_file_are_none(void **state)
{
    fixture *f = *state;
    bs_lines *lines = open_text(f, "", 0);

    check_line(f, lines, NULL);
    bs_lines_close(lines);
}

static void lines__leave_out_the_byte_order_mark(void **state)
{
    fixture *f = *state;
    bs_lines *lines = open_text(f,
                                "\xEF\xBB\xBF"
                                "C\n",
                                5);

    check_line(f, lines, "C");
    check_line(f, lines, NULL);
    bs_lines_close(lines);
}

static void lines__keep_nul_bytes(void **state)
{
    fixture *f = *state;
    bs_lines *lines = open_text(f, "a\0b\n", 4);
    const char *text;
    size_t length;

    check_ok(f, bs_lines_next(lines, &text, &length));
    assert_int_equal(length, 3);
    assert_memory_equal(text, "a\0b", 3);
    bs_lines_close(lines);
}

/* 40,000 lines of 1 to 9 digits cross the blocks at all places. */
static void lines__across_blocks_are_whole(void **state)
{
    fixture *f = *state;
    bs_text text;
    bs_lines *lines;

    bs_text_init(&text, &f->cx);
    for (int i = 0; i < 40000; i++)
        check_ok(f, bs_text_printf(&text, "%d\n", i * 7919));
    scratch_write_gzip(NAME, text.data, text.length, 1);
    bs_text_free(&text);
    check_ok(f, bs_lines_open(&f->cx, NAME, 1000, &lines));
    for (int i = 0; i < 40000; i++) {
        char expected[20];

        snprintf(expected, sizeof expected, "%d", i * 7919);
        check_line(f, lines, expected);
    }
    check_line(f, lines, NULL);
    bs_lines_close(lines);
}

static void lines__that_are_too_long_are_refused_and_skipped(void **state)
{
    fixture *f = *state;
    bs_text text;
    const char *line;
    size_t length;
    bs_lines *lines;

    bs_text_init(&text, &f->cx);
    check_ok(f, bs_text_puts(&text, "before\n"));
    for (int i = 0; i < 300000; i++)
        check_ok(f, bs_text_putc(&text, 'x'));
    check_ok(f, bs_text_puts(&text, "\nbehind\n"));
    lines = open_text(f, text.data, text.length);
    bs_text_free(&text);
    check_line(f, lines, "before");
    assert_int_equal(bs_lines_next(lines, &line, &length), BS_ELIMIT);
    assert_string_equal(f->cx.error.message, "line 2 is longer than 1000 bytes");
    assert_int_equal(f->cx.error.line, 2);
    assert_true(bs_lines_can_go_on(lines));
    check_line(f, lines, "behind");
    check_line(f, lines, NULL);
    bs_lines_close(lines);
}

static void lines__of_a_cut_gzip_file_end_in_an_error(void **state)
{
    fixture *f = *state;
    const char *text;
    size_t length;
    bs_lines *lines;
    bs_status st;

    scratch_write_gzip(NAME, "CCO ethanol\n", 12, 1000);
    scratch_cut(NAME, 40);
    check_ok(f, bs_lines_open(&f->cx, NAME, 1000, &lines));
    do
        st = bs_lines_next(lines, &text, &length);
    while (st == BS_OK && text);
    assert_int_equal(st, BS_EFILE);
    assert_non_null(strstr(f->cx.error.message, "is cut short"));
    assert_false(bs_lines_can_go_on(lines));
    bs_lines_close(lines);
}

static void lines__of_a_damaged_gzip_file_end_in_an_error(void **state)
{
    fixture *f = *state;
    static const char text[] = "\x1f\x8b\x08\x00\x00\x00\x00\x00\x00\x03\xff\xff\xff\xff\xff\xff";
    bs_lines *lines = open_text(f, text, sizeof text - 1);
    const char *line;
    size_t length;

    assert_int_equal(bs_lines_next(lines, &line, &length), BS_EFILE);
    bs_lines_close(lines);
}

/* 100 MB of empty lines in 100 KB. */
static void lines__of_a_gzip_bomb_are_not_read_on(void **state)
{
    fixture *f = *state;
    static char block[1 << 20];
    const char *text;
    size_t length;
    bs_lines *lines;
    bs_status st;

    memset(block, '\n', sizeof block);
    scratch_write_gzip(NAME, block, sizeof block, 100);
    check_ok(f, bs_lines_open(&f->cx, NAME, 1000, &lines));
    do
        st = bs_lines_next(lines, &text, &length);
    while (st == BS_OK && text);
    assert_int_equal(st, BS_ELIMIT);
    assert_non_null(strstr(f->cx.error.message, "times its size"));
    assert_false(bs_lines_can_go_on(lines));
    assert_true(atomic_load(&f->cx.own_gate.used) < 1 << 20);
    bs_lines_close(lines);
}

static void lines__of_what_is_no_file_are_refused(void **state)
{
    fixture *f = *state;
    bs_lines *lines;

    assert_int_equal(bs_lines_open(&f->cx, "no/such/file", 1000, &lines), BS_EFILE);
    assert_null(lines);
    assert_int_equal(bs_lines_open(&f->cx, ".", 1000, &lines), BS_EFILE);
    assert_non_null(strstr(f->cx.error.message, "is not a regular file"));
}

static void lines__give_everything_back_when_memory_runs_out(void **state)
{
    fixture *f = *state;

    scratch_write(NAME, "C\n", 2);
    for (long allowed = 0; allowed < 2; allowed++) {
        bs_lines *lines;

        atomic_store(&f->cx.own_gate.fail_after, allowed);
        assert_int_equal(bs_lines_open(&f->cx, NAME, 1000, &lines), BS_ENOMEM);
        assert_null(lines);
    }
    atomic_store(&f->cx.own_gate.fail_after, -1);
}

static int remove_file(void **state)
{
    (void)state;
    remove(NAME);
    return 0;
}

int main(void)
{
    const struct CMUnitTest tests[] = {
        check_case(lines__end_at_lf_or_crlf),
        check_case(lines__of_an_empty_file_are_none),
        check_case(lines__leave_out_the_byte_order_mark),
        check_case(lines__keep_nul_bytes),
        check_case(lines__across_blocks_are_whole),
        check_case(lines__that_are_too_long_are_refused_and_skipped),
        check_case(lines__of_a_cut_gzip_file_end_in_an_error),
        check_case(lines__of_a_damaged_gzip_file_end_in_an_error),
        check_case(lines__of_a_gzip_bomb_are_not_read_on),
        check_case(lines__of_what_is_no_file_are_refused),
        check_case(lines__give_everything_back_when_memory_runs_out),
    };

    return cmocka_run_group_tests_name("core.lines", tests, NULL, remove_file);
}
