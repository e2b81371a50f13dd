/* The search for matches. */
#include "match/search.h"

#include <string.h>

static inline uint32_t sort_bit(const bs_bond *bond)
{
    return (uint32_t)1 << ((bond->order & 7) | (bond->flags & (BS_BOND_AROMATIC | BS_BOND_RING))
                                                   << 3);
}

/* ---- Beginning ------------------------------------------------------------------------- */

static bs_status spell_hydrogens(bs_search *s)
{
    const bs_mol *mol = s->mol;
    bs_atom *atoms;
    bs_status st = bs_new(s->cx, &s->cx->scratch, mol->atom_count, &atoms);

    if (st != BS_OK)
        return st;
    for (uint32_t i = 0; i < mol->atom_count; i++) {
        int total = bs_mol__total_hydrogens(mol, i);

        atoms[i] = mol->atoms[i];
        atoms[i].hydrogens = (uint8_t)(total < UINT8_MAX ? total : UINT8_MAX);
        atoms[i].label = (uint16_t)(atoms[i].hydrogens - mol->atoms[i].hydrogens);
    }
    s->atoms = atoms;
    s->spelt_hydrogens = true;
    return BS_OK;
}

static bs_status find_components(bs_search *s)
{
    uint32_t count = s->mol->atom_count, *pile, height = 0;
    bs_status st;

    if ((st = bs_new(s->cx, &s->cx->scratch, count, &s->component)) != BS_OK ||
        (st = bs_new(s->cx, &s->cx->scratch, count, &pile)) != BS_OK)
        return st;
    for (uint32_t i = 0, number = 1; i < count; i++) {
        if (s->component[i] != 0)
            continue;
        s->component[i] = number;
        pile[height++] = i;
        while (height > 0) {
            uint32_t atom = pile[--height];

            for (int k = 0; k < s->atoms[atom].degree; k++) {
                uint32_t other = s->links[s->offsets[atom] + (uint32_t)k].atom;

                if (s->component[other] == 0) {
                    s->component[other] = number;
                    pile[height++] = other;
                }
            }
        }
        number++;
    }
    return BS_OK;
}

bs_status bs_search__begin(bs_search *s, bs_ctx *cx, const bs_pattern *pattern, const bs_mol *mol,
                           long steps)
{
    int slots = pattern->slot_count;
    bs_status st = BS_OK;

    s->cx = cx;
    s->pattern = pattern;
    s->mol = mol;
    s->atoms = mol->atoms;
    s->bonds = bs_mol__bonds(mol);
    s->offsets = bs_mol__at(mol, mol->offsets_at);
    s->links = bs_mol__at(mol, mol->links_at);
    s->spelt_hydrogens = false;
    s->memo = NULL;
    s->component = NULL;
    s->given = s->steps = steps > 0 ? steps : BS_SEARCH_STEPS;
    s->status = BS_OK;
    s->placed = s->small;
    s->iter = s->small + BS_SEARCH_SMALL;
    if (slots > BS_SEARCH_SMALL) {
        if ((st = bs_new(cx, &cx->scratch, slots, &s->placed)) != BS_OK ||
            (st = bs_new(cx, &cx->scratch, slots, &s->iter)) != BS_OK)
            return st;
    }
    if (pattern->part_count > 1)
        st = bs_new_array(cx, &cx->scratch, (size_t)pattern->part_count, mol->atom_count, &s->memo);
    if (st == BS_OK && mol->features[0] >> BS_FEATURE_HYDROGEN_ATOM & 1)
        st = spell_hydrogens(s);
    if (st == BS_OK && pattern->grouped)
        st = find_components(s);
    return st;
}

void bs_search__frame(const bs_search *s, const bs_order *order, uint32_t anchor, bs_frame *f)
{
    f->part = &s->pattern->parts[0];
    f->order = order ? order : &f->part->order;
    f->placed = s->placed + f->part->slot;
    f->iter = s->iter + f->part->slot;
    f->anchor = anchor;
    f->depth = 0;
    f->iter[0] = 0;
}

/* ---- Atom tests ------------------------------------------------------------------------ */

/* Whether a recursive part matches with its first atom here. The depth was counted on reading. */
static bool recurse(bs_search *s, int part, uint32_t atom)
{
    uint8_t *known = &s->memo[(size_t)part * s->mol->atom_count + atom];
    const bs_part *p = &s->pattern->parts[part];
    bs_frame f = {p, &p->order, s->placed + p->slot, s->iter + p->slot, atom, 0};
    bool found;

    if (*known)
        return *known == 2;
    f.iter[0] = 0;
    found = bs_search__next(s, &f);
    if (s->status == BS_OK)
        *known = found ? 2 : 1;
    return found;
}

static bool passes_special(bs_search *s, const bs_node *node, uint32_t atom,
                           const bs_centre *centre, const bs_frame *f)
{
    const bs_atom *a = &s->atoms[atom];
    int folded = a->hydrogens - (s->spelt_hydrogens ? a->label : 0);

    switch (node->kind) {
    case BS_NODE_CONNECTIONS:
        return a->degree + folded == node->argument;
    case BS_NODE_IMPLICIT_H:
        return node->argument < 0 ? folded > 0 : folded == node->argument;
    case BS_NODE_HYBRID:
        return bs_search__hybridisation(s, atom) == node->argument;
    case BS_NODE_RECURSE:
        return recurse(s, node->argument, atom);
    default:
        return !centre || bs_search__hand_fits(s, centre, f, node->argument);
    }
}

static inline bool fields_fit(const uint64_t *mask, const uint64_t *value, const bs_atom *atom)
{
    uint64_t word[2];

    memcpy(word, atom, sizeof word);
    return (((word[0] & mask[0]) ^ value[0]) | ((word[1] & mask[1]) ^ value[1])) == 0;
}

/* The tests from `entry` on; most expressions are one comparison of fields. */
static inline bool passes(bs_search *s, int32_t entry, uint32_t atom, const bs_centre *centre,
                          const bs_frame *f)
{
    while (entry >= 0) {
        const bs_node *node = &s->pattern->nodes[entry];
        bool yes = node->kind == BS_NODE_FIELDS
                       ? fields_fit(node->mask, node->value, &s->atoms[atom])
                       : passes_special(s, node, atom, centre, f);

        entry = yes ? node->yes : node->no;
    }
    return entry == BS_NODE_YES;
}

bool bs_search__passes(bs_search *s, int32_t entry, uint32_t atom, const bs_centre *centre,
                       const bs_frame *f)
{
    return passes(s, entry, atom, centre, f);
}

/* ---- Moves ----------------------------------------------------------------------------- */

static bool is_taken(const uint32_t *placed, int depth, uint32_t atom)
{
    for (int i = 0; i < depth; i++)
        if (placed[i] == atom)
            return true;
    return false;
}

static bool closes(const bs_search *s, const bs_frame *f, const bs_move *move, uint32_t atom)
{
    const bs_link *links = s->links + s->offsets[atom];
    int degree = s->atoms[atom].degree;

    for (int i = 0; i < move->closure_count; i++) {
        const bs_closure *closure = &f->order->closures[move->closure_first + i];
        uint32_t other = f->placed[closure->move];
        int k = 0;

        while (k < degree && links[k].atom != other)
            k++;
        if (k == degree || !(closure->sorts & sort_bit(&s->bonds[links[k].bond])))
            return false;
    }
    return true;
}

/* Atoms of one group lie in one component, those of two groups in two. */
static bool group_fits(const bs_search *s, const bs_frame *f, int depth, uint32_t atom)
{
    const bs_move *moves = f->order->moves;
    int group = moves[depth].group;

    for (int i = 0; i < depth && group != 0; i++)
        if (moves[i].group != 0 &&
            (moves[i].group == group) != (s->component[f->placed[i]] == s->component[atom]))
            return false;
    return true;
}

/* Whether an atom passes what is asked first of it: most do not. */
static inline bool opens(const bs_move *move, const bs_atom *atom)
{
    const bs_opening *first = &move->opening;

    return fields_fit(first->mask, first->value, atom) && atom->degree >= move->min_degree &&
           atom->ring_bonds >= move->min_ring_bonds;
}

/* The next atom at or behind `atom` for a move that starts anywhere, or BS_FREE. */
static inline uint32_t next_start(const bs_search *s, const bs_move *move, uint32_t atom)
{
    uint32_t count = s->mol->atom_count;

    while (atom < count && !opens(move, &s->atoms[atom]))
        atom++;
    return atom < count ? atom : BS_FREE;
}

/* The next atom that a move could go to, or BS_FREE; moves the iterator on. */
static inline uint32_t candidate(const bs_search *s, const bs_frame *f, int depth)
{
    const bs_move *move = &f->order->moves[depth];
    uint32_t *iter = &f->iter[depth], next;

    if (move->from >= 0) {
        uint32_t from = f->placed[move->from];
        const bs_link *links = s->links + s->offsets[from];
        uint32_t degree = s->atoms[from].degree;

        while (*iter < degree) {
            const bs_link *link = &links[(*iter)++];

            if ((move->sorts & sort_bit(&s->bonds[link->bond])) &&
                opens(move, &s->atoms[link->atom]))
                return link->atom;
        }
        return BS_FREE;
    }
    if (depth == 0 && f->anchor != BS_FREE)
        return (*iter)++ == 0 && opens(move, &s->atoms[f->anchor]) ? f->anchor : BS_FREE;
    next = next_start(s, move, *iter);
    *iter = next + (next != BS_FREE);
    return next;
}

static bool may_place(bs_search *s, const bs_frame *f, int depth, uint32_t atom)
{
    const bs_move *move = &f->order->moves[depth];

    return !is_taken(f->placed, depth, atom) && passes(s, move->opening.rest, atom, NULL, f) &&
           (move->closure_count == 0 || closes(s, f, move, atom)) &&
           (!f->part->grouped || group_fits(s, f, depth, atom));
}

/* Counts a step; false when the budget is used up or the search is stopped. */
static inline bool count_step(bs_search *s)
{
    if (s->status != BS_OK)
        return false;
    if (--s->steps < 0)
        s->status = bs_fail(s->cx, BS_ELIMIT, "the search for the pattern took too many steps");
    else if ((s->steps & 4095) == 0)
        s->status = bs_poll(s->cx);
    return s->status == BS_OK;
}

bool bs_search__next(bs_search *s, bs_frame *f)
{
    int last = f->order->count - 1, depth = f->depth;
    bool stereo = f->part->centre_count > 0 || f->part->turn_count > 0;

    while (depth >= 0) {
        uint32_t atom = candidate(s, f, depth);

        if (atom == BS_FREE) {
            depth--;
            continue;
        }
        if (!count_step(s))
            break;
        if (!may_place(s, f, depth, atom))
            continue;
        f->placed[depth] = atom;
        if (depth < last) {
            f->iter[++depth] = 0;
            continue;
        }
        if (stereo && !bs_search__stereo_fits(s, f))
            continue;
        f->depth = depth;
        return s->status == BS_OK;
    }
    f->depth = -1;
    return false;
}
