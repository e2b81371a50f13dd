/* The hash map. */
#include "support/check.h"

#include "core/map.h"

static void map__finds_every_entry_among_many(void **state)
{
    fixture *f = *state;
    bs_map map;

    bs_map_init(&map, &f->cx);
    for (uint32_t i = 0; i < 10000; i++)
        check_ok(f, bs_map_add(&map, (uint64_t)i * 977, i));
    for (uint32_t i = 0; i < 10000; i++) {
        size_t cursor = 0;

        assert_int_equal(bs_map_next(&map, (uint64_t)i * 977, &cursor), i);
        assert_int_equal(bs_map_next(&map, (uint64_t)i * 977, &cursor), BS_MAP_NONE);
    }
    size_t cursor = 0;
    assert_int_equal(bs_map_next(&map, 976, &cursor), BS_MAP_NONE);
    bs_map_free(&map);
}

static void map__entries_may_share_a_key(void **state)
{
    fixture *f = *state;
    bs_map map;
    bool seen[3] = {false, false, false};
    size_t cursor = 0;
    uint32_t value;

    bs_map_init(&map, &f->cx);
    for (uint32_t i = 0; i < 3; i++)
        check_ok(f, bs_map_add(&map, 42, i));
    while ((value = bs_map_next(&map, 42, &cursor)) != BS_MAP_NONE)
        seen[value] = true;
    assert_true(seen[0] && seen[1] && seen[2]);
    bs_map_free(&map);
}

static void map__failed_growth_leaves_it_whole(void **state)
{
    fixture *f = *state;
    bs_map map;
    size_t cursor = 0;

    bs_map_init(&map, &f->cx);
    for (uint32_t i = 0; i < 12; i++)
        check_ok(f, bs_map_add(&map, i, i));
    atomic_store(&f->cx.own_gate.fail_after, 0);
    assert_int_equal(bs_map_add(&map, 99, 99), BS_ENOMEM);
    atomic_store(&f->cx.own_gate.fail_after, -1);
    assert_int_equal(map.count, 12);
    assert_int_equal(bs_map_next(&map, 11, &cursor), 11);
    bs_map_free(&map);
}

int main(void)
{
    const struct CMUnitTest tests[] = {
        check_case(map__finds_every_entry_among_many),
        check_case(map__entries_may_share_a_key),
        check_case(map__failed_growth_leaves_it_whole),
    };

    return cmocka_run_group_tests_name("core.map", tests, NULL, NULL);
}
