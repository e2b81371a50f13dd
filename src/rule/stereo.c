/*
 * Stereo of a draft under edit: kept, turned, made or lost.
 *
 * A centre whose neighbours change keeps its hand if one neighbour is exchanged for one other,
 * which then stands in its place; the rule's marks may say that the centre is turned besides. A
 * double bond keeps its geometry as long as each end keeps one of its neighbours.
 */
#include <string.h>

#include "rule/edit.h"

/* The neighbours of an atom after the edit; `hydrogen` if an implied one counts as well. */
typedef struct ring_of {
    uint32_t atoms[8];
    int count;
    bool hydrogen;
} ring_of;

static void look_around(const bs_edit *edit, uint32_t centre, ring_of *out)
{
    const bs_draft *draft = &edit->draft;

    memset(out, 0, sizeof *out);
    for (uint32_t i = 0; i < draft->bond_count; i++) {
        const bs_draft_bond *bond = &draft->bonds[i];

        if (bond->gone || (bond->a != centre && bond->b != centre))
            continue;
        if (out->count < 8)
            out->atoms[out->count] = bond->a == centre ? bond->b : bond->a;
        out->count++;
    }
    out->hydrogen = draft->atoms[centre].hydrogens == 1;
}

static bool is_near(const ring_of *ring, uint32_t atom)
{
    for (int i = 0; i < ring->count && i < 8; i++) {
        if (ring->atoms[i] == atom)
            return true;
    }
    return false;
}

/* Whether three neighbours make a centre, a lone pair being the fourth. */
static bool has_lone_pair(int element)
{
    return element == 7 || element == 15 || element == 16 || element == 33 || element == 34;
}

static const bs_hand_edit *hand_edit_of(const bs_edit *edit, uint32_t centre)
{
    const bs_reading *r = edit->bench->reading;

    for (int i = 0; i < r->hand_edits; i++) {
        if (edit->slot[r->hands[i].slot] == centre)
            return &r->hands[i];
    }
    return NULL;
}

/* ---- Centres ------------------------------------------------------------------------------------
 */

/* Exchanges one neighbour of the element for another; false if more than that has changed. */
static bool exchange(const bs_edit *edit, bs_draft_stereo *element)
{
    ring_of now;
    int left = 0, at = 0, came = 0;
    uint32_t newcomer = BS_DRAFT_HYDROGEN;
    bool held_hydrogen = false;

    look_around(edit, element->centre, &now);
    if (now.count == 3 && !now.hydrogen &&
        has_lone_pair(edit->draft.atoms[element->centre].element))
        now.hydrogen = true;
    if (now.count + now.hydrogen != 4)
        return false;
    for (int i = 0; i < 4; i++) {
        uint32_t atom = element->around[i];
        bool hydrogen = atom == BS_DRAFT_HYDROGEN;

        held_hydrogen = held_hydrogen || hydrogen;
        if (hydrogen ? !now.hydrogen : !is_near(&now, atom)) {
            left++;
            at = i;
        }
    }
    for (int i = 0; i < now.count; i++) {
        bool known = false;

        for (int k = 0; k < 4; k++)
            known = known || element->around[k] == now.atoms[i];
        if (!known) {
            came++;
            newcomer = now.atoms[i];
        }
    }
    came += now.hydrogen && !held_hydrogen;
    if (left == 1 && came == 1)
        element->around[at] = newcomer;
    return left == came && left <= 1;
}

static void move_centre(const bs_edit *edit, bs_draft_stereo *element)
{
    const bs_hand_edit *hand = hand_edit_of(edit, element->centre);
    bool touched = edit->atoms[element->centre] & BS_EDIT_TOUCHED;

    if (hand && (hand->way == BS_HAND_MAKE || hand->way == BS_HAND_LOSE)) {
        element->perm = 0;
        return;
    }
    if (touched && !exchange(edit, element))
        element->perm = 0;
    if (hand && hand->way == BS_HAND_TURN && element->perm != 0)
        element->perm = (uint8_t)(3 - element->perm);
}

/* The fourth neighbour of a centre of which the rule writes three; false if there is none. */
static bool find_rest(const bs_edit *edit, const ring_of *now, const bs_draft_stereo *element,
                      int unwritten, uint32_t *rest)
{
    int others = 0;

    for (int i = 0; i < now->count && i < 8; i++) {
        bool written = false;

        for (int k = 0; k < 4; k++)
            written = written || (k != unwritten && element->around[k] == now->atoms[i]);
        if (!written) {
            *rest = now->atoms[i];
            others++;
        }
    }
    if (others == 0) {
        *rest = BS_DRAFT_HYDROGEN;
        return now->hydrogen || edit->draft.atoms[element->centre].hydrogens == BS_DRAFT_IMPLIED ||
               has_lone_pair(edit->draft.atoms[element->centre].element);
    }
    return others == 1 && !now->hydrogen;
}

static bs_status make_centre(bs_edit *edit, const bs_hand_edit *hand)
{
    bs_draft_stereo element = {.kind = BS_STEREO_TETRAHEDRAL, .perm = (uint8_t)hand->mark};
    ring_of now;
    int unwritten = -1;

    element.centre = edit->slot[hand->slot];
    look_around(edit, element.centre, &now);
    for (int i = 0; i < 4; i++) {
        if (hand->around[i] == BS_SIDE_REST) {
            if (unwritten >= 0)
                return BS_OK;
            unwritten = i;
            continue;
        }
        element.around[i] = edit->slot[hand->around[i]];
        if (!is_near(&now, element.around[i]))
            return BS_OK;
    }
    if (unwritten >= 0 && !find_rest(edit, &now, &element, unwritten, &element.around[unwritten]))
        return BS_OK;
    return bs_draft_add_stereo(&edit->draft, element);
}

/* ---- Double bonds -------------------------------------------------------------------------------
 */

static bool is_double_still(const bs_edit *edit, uint32_t a, uint32_t b)
{
    const bs_draft *draft = &edit->draft;

    for (uint32_t i = 0; i < draft->bond_count; i++) {
        const bs_draft_bond *bond = &draft->bonds[i];

        if (!bond->gone && ((bond->a == a && bond->b == b) || (bond->a == b && bond->b == a)))
            return bond->order == 2 && !(edit->bonds[i] & BS_EDIT_BOND_CHANGED);
    }
    return false;
}

static const bs_slope_edit *slope_edit_of(const bs_edit *edit, uint32_t a, uint32_t b)
{
    const bs_reading *r = edit->bench->reading;

    for (int i = 0; i < r->slope_edits; i++) {
        uint32_t x = edit->slot[r->slopes[i].x], y = edit->slot[r->slopes[i].y];

        if ((x == a && y == b) || (x == b && y == a))
            return &r->slopes[i];
    }
    return NULL;
}

/* The neighbour other than `not` that `end` had beside `reference` before the edit, or NOWHERE. */
static uint32_t other_before(const bs_edit *edit, uint32_t end, uint32_t not, uint32_t reference)
{
    for (uint32_t i = 0; i < edit->bench->bond_count; i++) {
        const bs_draft_bond *bond = &edit->bench->bonds[i];
        uint32_t atom = bond->a == end ? bond->b : bond->a;

        if ((bond->a == end || bond->b == end) && atom != not &&atom != reference)
            return atom;
    }
    return BS_NOWHERE;
}

/* Finds a neighbour of an end to refer to; *turned if it stands on the other side. */
static bool refer(const bs_edit *edit, uint32_t end, uint32_t not, uint32_t *reference,
                  bool *turned)
{
    uint32_t other = other_before(edit, end, not, *reference);
    ring_of now;

    look_around(edit, end, &now);
    if (is_near(&now, *reference))
        return true;
    if (other != BS_NOWHERE && is_near(&now, other)) {
        *turned = !*turned;
        *reference = other;
        return true;
    }
    if (other != BS_NOWHERE || now.count != 2)
        return false;
    *reference = now.atoms[0] == not ? now.atoms[1] : now.atoms[0];
    return true;
}

static void move_double(const bs_edit *edit, bs_draft_stereo *element)
{
    bool turned = false;

    if (slope_edit_of(edit, element->centre, element->second) ||
        !is_double_still(edit, element->centre, element->second) ||
        !refer(edit, element->centre, element->second, &element->around[0], &turned) ||
        !refer(edit, element->second, element->centre, &element->around[1], &turned)) {
        element->perm = 0;
        return;
    }
    if (turned)
        element->perm = (uint8_t)(3 - element->perm);
}

static bs_status make_double(bs_edit *edit, const bs_slope_edit *slope)
{
    bs_draft_stereo element = {.kind = BS_DRAFT_DOUBLE, .perm = (uint8_t)slope->perm};

    if (slope->perm == 0)
        return BS_OK;
    element.centre = edit->slot[slope->x];
    element.second = edit->slot[slope->y];
    element.around[0] = edit->slot[slope->rx];
    element.around[1] = edit->slot[slope->ry];
    return bs_draft_add_stereo(&edit->draft, element);
}

/* ---- All
 * ------------------------------------------------------------------------------------------ */

/* Allenes, squares and the like stay only where nothing near them changed. */
static void move_other(const bs_edit *edit, bs_draft_stereo *element)
{
    if (edit->atoms[element->centre] & BS_EDIT_TOUCHED)
        element->perm = 0;
    for (int i = 0; i < 6; i++) {
        uint32_t atom = element->around[i];

        if (element->kind <= BS_STEREO_SQUARE && i >= 4)
            break;
        if (element->kind == BS_STEREO_TRIGONAL_BIPYRAMID && i >= 5)
            break;
        if (atom != BS_DRAFT_HYDROGEN &&
            (edit->draft.atoms[atom].gone || (edit->atoms[atom] & BS_EDIT_TOUCHED)))
            element->perm = 0;
    }
}

bs_status bs_edit__move_stereo(bs_edit *edit)
{
    const bs_reading *r = edit->bench->reading;
    bs_status st = BS_OK;

    for (uint32_t i = 0; i < edit->draft.stereo_count; i++) {
        bs_draft_stereo *element = &edit->draft.stereo[i];

        if (edit->draft.atoms[element->centre].gone)
            element->perm = 0;
        else if (element->kind == BS_STEREO_TETRAHEDRAL)
            move_centre(edit, element);
        else if (element->kind == BS_DRAFT_DOUBLE)
            move_double(edit, element);
        else
            move_other(edit, element);
    }
    for (int i = 0; i < r->hand_edits && st == BS_OK; i++) {
        if (r->hands[i].way == BS_HAND_MAKE)
            st = make_centre(edit, &r->hands[i]);
    }
    for (int i = 0; i < r->slope_edits && st == BS_OK; i++)
        st = make_double(edit, &r->slopes[i]);
    return st == BS_OK ? bs_edit__add_faces(edit) : st;
}
