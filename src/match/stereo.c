/* Tests on the shape of a match: hands, double bonds, hybridisation. */
#include "chem/hybrid.h"
#include "match/search.h"

/* ---- Hands ----------------------------------------------------------------------------- */

/* The place of a neighbour among the four of a centre, the implied one first; -1 for none. */
static int place_of(const bs_search *s, uint32_t centre, uint32_t neighbour)
{
    const bs_link *links = s->links + s->offsets[centre];
    int degree = s->atoms[centre].degree;

    for (int k = 0; k < degree; k++)
        if (links[k].atom == neighbour)
            return k + (degree == 3);
    return -1;
}

/* Whether the places are an odd permutation of 0 to 3. */
static bool is_odd(const int place[4])
{
    int swaps = 0;

    for (int i = 0; i < 4; i++)
        for (int k = i + 1; k < 4; k++)
            swaps += place[i] > place[k];
    return swaps % 2 != 0;
}

/*
 * The places of the pattern's neighbours around the atom; the one that is not written takes the
 * place that is left. False unless this makes all four.
 */
static bool find_places(const bs_search *s, const bs_centre *centre, const bs_frame *f,
                        uint32_t atom, int place[4])
{
    int left = 0 + 1 + 2 + 3, unwritten = -1;

    if (centre->around_count != 4)
        return false;
    for (int i = 0; i < 4; i++) {
        if (centre->around[i] < 0) {
            unwritten = i;
            continue;
        }
        place[i] = place_of(s, atom, f->placed[f->order->place[centre->around[i]]]);
        if (place[i] < 0)
            return false;
        left -= place[i];
    }
    if (unwritten >= 0)
        place[unwritten] = left;
    return true;
}

bool bs_search__hand_fits(const bs_search *s, const bs_centre *centre, const bs_frame *f, int test)
{
    uint32_t atom = f->placed[f->order->place[centre->atom]];
    const bs_atom *a = &s->atoms[atom];
    int place[4], seen;

    if (a->stereo != BS_STEREO_TETRAHEDRAL || a->degree < 3 || a->degree > 4)
        return test > 2;
    /* With fewer neighbours than tell the hands apart, any hand will do. */
    if (!find_places(s, centre, f, atom, place))
        return true;
    seen = is_odd(place) ? 3 - a->perm : a->perm;
    return seen == (test > 2 ? test - 2 : test);
}

/* ---- Double bonds ---------------------------------------------------------------------- */

static const bs_bond *bond_between(const bs_search *s, uint32_t a, uint32_t b)
{
    const bs_link *links = s->links + s->offsets[a];

    for (int k = 0; k < s->atoms[a].degree; k++)
        if (links[k].atom == b)
            return &s->bonds[links[k].bond];
    return NULL;
}

/* The neighbour of an end to which the geometry of its double bond refers. */
static uint32_t first_beside(const bs_search *s, uint32_t end, uint32_t other_end)
{
    const bs_link *links = s->links + s->offsets[end];

    return links[0].atom != other_end ? links[0].atom
           : s->atoms[end].degree > 1 ? links[1].atom
                                      : BS_FREE;
}

static bool turn_fits(const bs_search *s, const bs_turn *turn, const bs_frame *f)
{
    const int32_t *place = f->order->place;
    const bs_bond *bond =
        bond_between(s, f->placed[place[turn->middle[0]]], f->placed[place[turn->middle[1]]]);
    bool cis;

    if (!bond || bond->order != 2 || bond->flags & BS_BOND_AROMATIC)
        return true;
    if (!(bond->flags & (BS_BOND_CIS | BS_BOND_TRANS)))
        return turn->or_unspecified;
    cis = (bond->flags & BS_BOND_CIS) != 0;
    for (int i = 0; i < 2; i++) {
        uint32_t end = f->placed[place[turn->end[i]]], before = f->placed[place[turn->before[i]]];

        cis ^= first_beside(s, end, before) != f->placed[place[turn->beside[i]]];
    }
    return cis == turn->cis;
}

bool bs_search__stereo_fits(bs_search *s, const bs_frame *f)
{
    const bs_part *part = f->part;

    for (int i = 0; i < part->turn_count; i++)
        if (!turn_fits(s, &part->turns[i], f))
            return false;
    for (int i = 0; i < part->centre_count; i++) {
        const bs_centre *centre = &part->centres[i];
        uint32_t atom = f->placed[f->order->place[centre->atom]];

        if (!bs_search__passes(s, centre->entry, atom, centre, f))
            return false;
    }
    return true;
}

int bs_search__hybridisation(const bs_search *s, uint32_t atom)
{
    const bs_atom *a = &s->atoms[atom];
    int folded = a->hydrogens - (s->spelt_hydrogens ? a->label : 0);

    return bs_hybrid__of(s->atoms, s->bonds, s->offsets, s->links, atom, a->degree + folded);
}
