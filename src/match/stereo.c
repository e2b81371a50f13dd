/* Hands and geometries of a match whose atoms are all placed. */
#include "match/run.h"

#define AROUND 4
#define IMPLIED UINT32_MAX /* the hydrogen or lone pair of a centre */

/* The four places around a centre in the molecule's order. */
static bool molecule_around(const bs_mol *mol, uint32_t centre, uint32_t around[AROUND])
{
    const bs_link *links = bs_mol__links(mol, centre);
    int degree = mol->atoms[centre].degree, count = 0;

    if (degree != 3 && degree != 4)
        return false;
    if (degree == 3)
        around[count++] = IMPLIED;
    for (int k = 0; k < degree; k++)
        around[count++] = links[k].atom;
    return true;
}

/*
 * The same places in the order of the pattern; the one that the pattern does not name is what is
 * left. False if the pattern leaves more than one open.
 */
static bool pattern_around(const bs_match_search *search, const bs_query_atom *atom,
                           const uint32_t have[AROUND], uint32_t around[AROUND])
{
    int open = -1;

    if (atom->around_count != AROUND)
        return false;
    for (int k = 0; k < AROUND; k++) {
        if (atom->around[k] >= 0)
            around[k] = search->placed[atom->around[k]];
        else if (open < 0)
            open = k;
        else
            return false;
    }
    for (int i = 0; i < AROUND && open >= 0; i++) {
        bool named = false;

        for (int k = 0; k < AROUND; k++)
            named = named || (k != open && around[k] == have[i]);
        if (!named)
            around[open] = have[i];
    }
    return true;
}

static bool permutation_is_odd(const uint32_t a[AROUND], const uint32_t b[AROUND])
{
    int place[AROUND];
    bool odd = false;

    for (int i = 0; i < AROUND; i++) {
        place[i] = 0;
        for (int k = 0; k < AROUND; k++)
            if (b[k] == a[i])
                place[i] = k;
    }
    for (int i = 0; i < AROUND; i++)
        for (int k = i + 1; k < AROUND; k++)
            odd ^= place[i] > place[k];
    return odd;
}

/* The hand of a placed centre as the pattern would write it: 1 @, 2 @@, 0 none. */
static int hand_of(const bs_match_search *search, int atom)
{
    const bs_mol *mol = search->run->mol;
    const bs_query_atom *query = &search->pattern->query->atoms[atom];
    uint32_t centre = search->placed[atom], have[AROUND], asked[AROUND];
    const bs_atom *found = &mol->atoms[centre];

    if (found->stereo != BS_STEREO_TETRAHEDRAL || !molecule_around(mol, centre, have) ||
        !pattern_around(search, query, have, asked))
        return 0;
    return permutation_is_odd(have, asked) ? 3 - found->perm : found->perm;
}

/* Whether a neighbour of an end of a double bond is the one that its geometry refers to. */
static bool is_reference(const bs_mol *mol, uint32_t end, uint32_t other, uint32_t neighbour)
{
    const bs_link *links = bs_mol__links(mol, end);

    return (links[0].atom == other ? links[1].atom : links[0].atom) == neighbour;
}

static bool geometry_fits(const bs_match_search *search, const bs_geometry_check *check)
{
    const bs_mol *mol = search->run->mol;
    uint32_t a = search->placed[check->end_a], b = search->placed[check->end_b];
    int number = bs_mol_bond_between(mol, (int)a, (int)b);
    int flags = (int)bs_mol__bonds(mol)[number].flags;
    bool cis = flags & BS_BOND_CIS;

    if (!(flags & (BS_BOND_CIS | BS_BOND_TRANS)))
        return check->or_none;
    cis ^= !is_reference(mol, a, b, search->placed[check->beside_a]);
    cis ^= !is_reference(mol, b, a, search->placed[check->beside_b]);
    return cis == check->cis;
}

bool bs_match__stereo(const bs_match_search *search)
{
    const bs_pattern *pattern = search->pattern;

    for (int i = 0; i < pattern->geometry_count; i++)
        if (!geometry_fits(search, &pattern->geometries[i]))
            return false;
    for (int i = 0; i < pattern->hand_count; i++) {
        const bs_hand_check *check = &pattern->hands[i];

        if (!bs_match__atom(search->run, &check->whole, search->placed[check->atom],
                            hand_of(search, check->atom)))
            return false;
    }
    return true;
}
