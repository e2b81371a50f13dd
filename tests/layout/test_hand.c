/*
 * Stereo read from geometry. Expected perms follow from looking at the picture, or from turning
 * and mirroring it, which must keep or invert the hand.
 */
#include "support/check.h"

#include <math.h>

#include "layout/hand.h"

#define PI 3.14159265358979323846

static bs_spoke spoke(double degrees, int wedge)
{
    return (bs_spoke){cos(degrees * PI / 180), sin(degrees * PI / 180), wedge};
}

/*
 * Three bonds to the right, upper left and lower left run anticlockwise on the page. With one
 * towards the viewer the hydrogen points away; seen from the hydrogen the three run clockwise.
 */
static void flat__hydrogen_behind_the_page_sees_the_others_clockwise(void **state)
{
    (void)state;
    for (int k = 0; k < 3; k++) {
        bs_spoke s[3] = {spoke(0, 0), spoke(120, 0), spoke(240, 0)};

        s[k].wedge = 1;
        assert_int_equal(bs_hand__flat(s, 3), 2);
        s[k].wedge = -1;
        assert_int_equal(bs_hand__flat(s, 3), 1);
    }
}

/* The first of four points at the viewer, the others run anticlockwise: that is perm 1. */
static void flat__first_bond_towards_the_viewer_sees_the_others_as_on_the_page(void **state)
{
    bs_spoke s[4] = {spoke(45, 1), spoke(135, 0), spoke(225, 0), spoke(315, 0)};

    (void)state;
    assert_int_equal(bs_hand__flat(s, 4), 1);
    s[0].wedge = -1;
    assert_int_equal(bs_hand__flat(s, 4), 2);
}

static void flat__picture_may_be_turned_but_not_mirrored(void **state)
{
    (void)state;
    for (int turn = 0; turn < 360; turn += 7) {
        bs_spoke s[4] = {spoke(turn + 10, 0), spoke(turn + 100, -1), spoke(turn + 170, 0),
                         spoke(turn + 290, 0)};
        bs_spoke mirrored[4];
        int perm = bs_hand__flat(s, 4);

        for (int k = 0; k < 4; k++)
            mirrored[k] = (bs_spoke){-s[k].x, s[k].y, s[k].wedge};
        assert_int_equal(perm, 1);
        assert_int_equal(bs_hand__flat(mirrored, 4), 2);
    }
}

static void flat__opposite_wedges_agree_and_neighbours_contradict(void **state)
{
    bs_spoke s[4] = {spoke(45, 1), spoke(135, 0), spoke(225, 1), spoke(315, 0)};

    (void)state;
    assert_int_equal(bs_hand__flat(s, 4), 1);
    s[2].wedge = 0;
    s[1].wedge = -1;
    assert_int_equal(bs_hand__flat(s, 4), 1);
    s[1].wedge = 1;
    assert_int_equal(bs_hand__flat(s, 4), 0);
}

static void flat__says_nothing_without_wedges_or_in_a_t(void **state)
{
    bs_spoke none[3] = {spoke(0, 0), spoke(120, 0), spoke(240, 0)};
    bs_spoke t[3] = {spoke(0, 0), spoke(90, 1), spoke(180, 0)};
    bs_spoke side[3] = {spoke(0, 1), spoke(90, 0), spoke(180, 0)};

    (void)state;
    assert_int_equal(bs_hand__flat(none, 3), 0);
    assert_int_equal(bs_hand__flat(t, 3), 0);
    assert_int_equal(bs_hand__flat(side, 3), 2);
    assert_int_equal(bs_hand__flat(none, 2), 0);
}

/* The same tetrahedron in space and, seen from above, on the page. */
static void solid__agrees_with_the_page(void **state)
{
    bs_vector space[4] = {{0, 0, 1}, {1, 0, -0.3}, {-0.5, 0.87, -0.3}, {-0.5, -0.87, -0.3}};
    bs_vector mirrored[4];

    (void)state;
    assert_int_equal(bs_hand__solid(space, 4), 1);
    for (int k = 0; k < 4; k++)
        mirrored[k] = (bs_vector){space[k].x, space[k].y, -space[k].z};
    assert_int_equal(bs_hand__solid(mirrored, 4), 2);
    /* Without the first, a hydrogen stands in its place. */
    assert_int_equal(bs_hand__solid(space + 1, 3), 1);
    assert_int_equal(bs_hand__solid(mirrored + 1, 3), 2);
}

static void solid__three_bonds_in_a_plane_say_nothing(void **state)
{
    bs_vector plane[3] = {{1, 0, 0}, {-0.5, 0.87, 0}, {-0.5, -0.87, 0}};

    (void)state;
    assert_int_equal(bs_hand__solid(plane, 3), 0);
}

static void double__same_side_is_cis(void **state)
{
    bs_vector a = {0, 0, 0}, b = {1, 0, 0};
    bs_vector up = {-0.5, 0.87, 0}, up_b = {1.5, 0.87, 0}, down_b = {1.5, -0.87, 0};
    bs_vector line = {2, 0.01, 0}, out = {1.5, 0, 0.87};

    (void)state;
    assert_int_equal(bs_hand__double(a, b, up, up_b), 1);
    assert_int_equal(bs_hand__double(a, b, up, down_b), 2);
    assert_int_equal(bs_hand__double(a, b, up, line), 0);
    assert_int_equal(bs_hand__double(a, b, up, out), 0);
}

/* Mirroring the drawing or turning the wedge inverts an allene; in space it is the same. */
static void allene__wedge_and_side_give_the_hand(void **state)
{
    bs_vector a = {-1.3, 0, 0}, b = {1.3, 0, 0};
    bs_vector above = {-2, 1, 0}, below = {-2, -1, 0}, front = {2, 0, 1};
    int perm = bs_hand__flat_allene(a, b, above, 1);

    (void)state;
    assert_true(perm == 1 || perm == 2);
    assert_int_equal(bs_hand__flat_allene(a, b, above, -1), 3 - perm);
    assert_int_equal(bs_hand__flat_allene(a, b, below, 1), 3 - perm);
    assert_int_equal(bs_hand__solid_allene(a, b, above, front), perm);
}

int main(void)
{
    const struct CMUnitTest tests[] = {
        cmocka_unit_test(flat__hydrogen_behind_the_page_sees_the_others_clockwise),
        cmocka_unit_test(flat__first_bond_towards_the_viewer_sees_the_others_as_on_the_page),
        cmocka_unit_test(flat__picture_may_be_turned_but_not_mirrored),
        cmocka_unit_test(flat__opposite_wedges_agree_and_neighbours_contradict),
        cmocka_unit_test(flat__says_nothing_without_wedges_or_in_a_t),
        cmocka_unit_test(solid__agrees_with_the_page),
        cmocka_unit_test(solid__three_bonds_in_a_plane_say_nothing),
        cmocka_unit_test(double__same_side_is_cis),
        cmocka_unit_test(allene__wedge_and_side_give_the_hand),
    };

    return cmocka_run_group_tests_name("layout.hand", tests, NULL, NULL);
}
