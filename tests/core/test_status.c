/* Errors and the bounded reader. */
#include "support/check.h"

#include <stdio.h>
#include <stdlib.h>
#include <string.h>
#include <sys/stat.h>
#include <unistd.h>

static void fail__control_bytes_are_escaped(void **state)
{
    fixture *f = *state;

    assert_int_equal(bs_fail_at(&f->cx, BS_EVALUE, 3, "odd\n%s", "\x1b[31m"), BS_EVALUE);
    assert_string_equal(f->cx.error.message, "odd\\x0A\\x1B[31m");
    assert_int_equal(f->cx.error.offset, 3);
}

static void fail__long_messages_are_cut(void **state)
{
    fixture *f = *state;
    char long_text[2000];

    memset(long_text, '\a', sizeof long_text);
    long_text[sizeof long_text - 1] = '\0';
    bs_fail(&f->cx, BS_EVALUE, "%s", long_text);
    assert_true(strlen(f->cx.error.message) < BS_MESSAGE_MAX);
}

static void caret__stands_under_the_character(void **state)
{
    fixture *f = *state;
    char out[400];

    bs_fail_at(&f->cx, BS_ESYNTAX, 2, "x");
    bs_error_caret(&f->cx.error, "CC(C", 4, out, sizeof out);
    assert_string_equal(out, "  CC(C\n    ^");
    bs_fail(&f->cx, BS_ESYNTAX, "x");
    bs_error_caret(&f->cx.error, "CC(C", 4, out, sizeof out);
    assert_string_equal(out, "");
}

static void poll__reports_a_stop(void **state)
{
    fixture *f = *state;

    check_ok(f, bs_poll(&f->cx));
    atomic_store(f->cx.stop, true);
    assert_int_equal(bs_poll(&f->cx), BS_ESTOPPED);
    atomic_store(f->cx.stop, false);
}

static void read_file__refuses_what_is_no_regular_file(void **state)
{
    fixture *f = *state;
    char name[] = "/tmp/backsaw-test-XXXXXX", fifo[64];
    char *data;
    size_t length;

    assert_non_null(mkdtemp(name));
    snprintf(fifo, sizeof fifo, "%s/fifo", name);
    assert_int_equal(mkfifo(fifo, 0600), 0);
    assert_int_equal(bs_read_file(&f->cx, &f->home, fifo, 100, &data, &length), BS_EFILE);
    assert_int_equal(bs_read_file(&f->cx, &f->home, name, 100, &data, &length), BS_EFILE);
    assert_non_null(strstr(f->cx.error.message, "is not a regular file"));
    unlink(fifo);
    assert_int_equal(bs_read_file(&f->cx, &f->home, fifo, 100, &data, &length), BS_EFILE);
    assert_non_null(strstr(f->cx.error.message, "No such file"));
    rmdir(name);
}

static void read_file__keeps_the_limit(void **state)
{
    fixture *f = *state;
    char name[] = "/tmp/backsaw-test-XXXXXX";
    int fd = mkstemp(name);
    char *data;
    size_t length;

    assert_true(fd >= 0);
    assert_int_equal(write(fd, "a\0b", 3), 3);
    close(fd);
    assert_int_equal(bs_read_file(&f->cx, &f->home, name, 2, &data, &length), BS_ELIMIT);
    check_ok(f, bs_read_file(&f->cx, &f->home, name, 3, &data, &length));
    assert_int_equal(length, 3);
    assert_memory_equal(data, "a\0b", 4);
    unlink(name);
}

int main(void)
{
    const struct CMUnitTest tests[] = {
        check_case(fail__control_bytes_are_escaped),
        check_case(fail__long_messages_are_cut),
        check_case(caret__stands_under_the_character),
        check_case(poll__reports_a_stop),
        check_case(read_file__refuses_what_is_no_regular_file),
        check_case(read_file__keeps_the_limit),
    };

    return cmocka_run_group_tests_name("core.status", tests, NULL, NULL);
}
