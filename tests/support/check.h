/* What every test file includes first: cmocka and a context fixture. */
#ifndef SUPPORT_CHECK_H
#define SUPPORT_CHECK_H

#include <setjmp.h>
#include <stdarg.h>
#include <stddef.h>
#include <stdint.h>


#include <cmocka.h>

#include "backsaw/core.h"

/* A context and an arena for results; teardown asserts that nothing is left. */
typedef struct fixture {
    bs_ctx cx;
    bs_arena home;
} fixture;

static inline int fixture_setup(void **state)
{
    static fixture f;

    bs_ctx_init(&f.cx, NULL);
    bs_arena_init(&f.home, f.cx.gate);
    *state = &f;
    return 0;
}

static inline int fixture_teardown(void **state)
{
    fixture *f = *state;

    assert_int_equal(f->cx.scratch.live, 0);
    bs_arena_free(&f->home);
    bs_ctx_free(&f->cx);
    assert_int_equal(atomic_load(&f->cx.own_gate.used), 0);
    return 0;
}

#define check_case(function)                                                                       \
    cmocka_unit_test_setup_teardown(function, fixture_setup, fixture_teardown)

/*
 * Asserts that at least `least` requests for memory were failed in turn. Only where the arenas pass
 * each request on to the gate (the sanitizer builds); elsewhere they take a chunk, or none.
 */
#ifdef BS_ARENA_DEBUG
#define check_requests(count, least) assert_true((count) >= (least))
#else
#define check_requests(count, least) ((void)(count))
#endif

/* Fails with the error message if a call of the library did. */
#define check_ok(f, call)                                                                          \
    do {                                                                                           \
        if ((call) != BS_OK)                                                                       \
            fail_msg("%s: %s (offset %ld)", #call, (f)->cx.error.message, (f)->cx.error.offset);   \
    } while (0)

#endif
