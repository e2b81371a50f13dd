/* The text buffer. */
#include "support/check.h"

static void text__grows_and_ends_in_a_nul(void **state)
{
    fixture *f = *state;
    bs_text text;

    bs_text_init(&text, &f->cx);
    for (int i = 0; i < 1000; i++)
        check_ok(f, bs_text_printf(&text, "%d,", i % 10));
    assert_int_equal(text.length, 2000);
    assert_int_equal(text.data[2000], '\0');
    assert_memory_equal(text.data + 1990, "5,6,7,8,9,", 10);
    bs_text_free(&text);
}

static void text__a_failed_call_changes_nothing(void **state)
{
    fixture *f = *state;
    bs_text text;
    char block[100] = {0};

    bs_text_init(&text, &f->cx);
    check_ok(f, bs_text_puts(&text, "kept"));
    atomic_store(&f->cx.own_gate.fail_after, 0);
    assert_int_equal(bs_text_add(&text, block, sizeof block), BS_ENOMEM);
    atomic_store(&f->cx.own_gate.fail_after, -1);
    assert_string_equal(text.data, "kept");
    bs_text_free(&text);
}

int main(void)
{
    const struct CMUnitTest tests[] = {
        check_case(text__grows_and_ends_in_a_nul),
        check_case(text__a_failed_call_changes_nothing),
    };

    return cmocka_run_group_tests_name("core.text", tests, NULL, NULL);
}
