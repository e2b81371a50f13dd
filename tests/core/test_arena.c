/* Arenas and the allocation gate. */
#include "support/check.h"

#include <string.h>

static void arena__rewind_gives_back_what_came_after_the_mark(void **state)
{
    fixture *f = *state;
    bs_mark mark;
    int *first, *second;

    check_ok(f, bs_new(&f->cx, &f->home, 10, &first));
    first[9] = 7;
    mark = bs_arena_mark(&f->home);
    check_ok(f, bs_new(&f->cx, &f->home, 100000, &second));
    assert_int_equal(second[99999], 0);
    bs_arena_rewind(&f->home, mark);
    assert_int_equal(f->home.live, mark.live);
    assert_int_equal(first[9], 7);
}

static void arena__memory_is_cleared_after_a_rewind(void **state)
{
    fixture *f = *state;
    bs_mark mark = bs_arena_mark(&f->home);
    unsigned char *bytes;

    check_ok(f, bs_new(&f->cx, &f->home, 64, &bytes));
    memset(bytes, 0xFF, 64);
    bs_arena_rewind(&f->home, mark);
    check_ok(f, bs_new(&f->cx, &f->home, 64, &bytes));
    for (int i = 0; i < 64; i++)
        assert_int_equal(bytes[i], 0);
}

static void arena__overflowing_sizes_are_refused(void **state)
{
    fixture *f = *state;
    void *out = &f;

    assert_int_equal(bs_new_array(&f->cx, &f->home, SIZE_MAX / 2, 16, &out), BS_ENOMEM);
    assert_null(out);
    assert_string_equal(f->cx.error.message, "out of memory");
}

static void gate__limit_is_kept(void **state)
{
    fixture *f = *state;
    char *bytes;

    f->cx.own_gate.limit = 1 << 20;
    assert_int_equal(bs_new(&f->cx, &f->home, 2 << 20, &bytes), BS_ENOMEM);
    check_ok(f, bs_new(&f->cx, &f->home, 1000, &bytes));
    assert_true(atomic_load(&f->cx.own_gate.used) <= 1 << 20);
    f->cx.own_gate.limit = 0;
}

static void gate__the_nth_request_fails_and_those_after_it(void **state)
{
    fixture *f = *state;

    atomic_store(&f->cx.own_gate.fail_after, 2);
    for (int i = 0; i < 4; i++) {
        void *block = bs_gate_alloc(f->cx.gate, 8);

        if (i < 2)
            assert_non_null(block);
        else
            assert_null(block);
        bs_gate_free(f->cx.gate, block, 8);
    }
    atomic_store(&f->cx.own_gate.fail_after, -1);
}

int main(void)
{
    const struct CMUnitTest tests[] = {
        check_case(arena__rewind_gives_back_what_came_after_the_mark),
        check_case(arena__memory_is_cleared_after_a_rewind),
        check_case(arena__overflowing_sizes_are_refused),
        check_case(gate__limit_is_kept),
        check_case(gate__the_nth_request_fails_and_those_after_it),
    };

    return cmocka_run_group_tests_name("core.arena", tests, NULL, NULL);
}
