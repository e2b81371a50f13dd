/*
 * Reagents: parts of the precursors of which the rule leaves nothing open, such as nitric acid or
 * carbon dioxide. Run forwards, a transform needs not be given them.
 */
#include "backsaw/draft.h"
#include "chem/valence.h"
#include "rule/book.h"

/* Sum of the bond orders of an atom of a side, and its degree; -1 where an order is open. */
static int written_bonds(const bs_side *side, int atom, int *degree)
{
    int sum = 0;

    *degree = 0;
    for (int i = 0; i < side->bond_count; i++) {
        const bs_side_bond *bond = &side->bonds[i];
        int order = bond->says.order == BS_ORDER_DEFAULT ? 1 : bond->says.order;

        if (bond->a != atom && bond->b != atom)
            continue;
        if (order < 1 || order > 4)
            return -1;
        sum += order;
        ++*degree;
    }
    return sum;
}

/* Whether the target writes all bonds of an atom, so that nothing else can hang on it. */
static bool is_full(const bs_side *target, int atom)
{
    const bs_facts *says = &target->atoms[atom].says;
    int hydrogens = says->hydrogens == BS_UNSAID ? 0 : says->hydrogens, degree;
    int charge = says->charge == BS_UNSAID ? 0 : says->charge;
    int sum = written_bonds(target, atom, &degree);

    if (says->connections != BS_UNSAID)
        return says->connections == degree + hydrogens;
    return sum >= 0 && says->element > 0 && bs_valence__normal(says->element, charge)[0] != 0 &&
           bs_valence__implied(says->element, charge, sum + hydrogens) == 0;
}

static bool is_closed(const bs_case *kase, int part)
{
    for (int i = 0; i < kase->source.atom_count; i++) {
        const bs_side_atom *atom = &kase->source.atoms[i];
        int slot = kase->back.to_slot[i], degree;

        if (atom->part != part)
            continue;
        if (atom->says.element < 1 || atom->says.aromatic == 1 ||
            written_bonds(&kase->source, i, &degree) < 0)
            return false;
        if (slot < kase->target.atom_count && !is_full(&kase->target, slot))
            return false;
    }
    return true;
}

static bs_status draft_part(bs_ctx *cx, const bs_side *side, int part, bs_draft *draft)
{
    uint32_t *number;
    bs_status st = bs_new(cx, &cx->scratch, side->atom_count + 1, &number);

    for (int i = 0; i < side->atom_count && st == BS_OK; i++) {
        const bs_facts *says = &side->atoms[i].says;
        bs_draft_atom atom = {
            .element = (uint8_t)says->element,
            .charge = (int8_t)(says->charge == BS_UNSAID ? 0 : says->charge),
            .hydrogens =
                (int16_t)(says->hydrogens == BS_UNSAID ? BS_DRAFT_IMPLIED : says->hydrogens)};

        if (side->atoms[i].part == part)
            st = bs_draft_add_atom(draft, atom, &number[i]);
    }
    for (int i = 0; i < side->bond_count && st == BS_OK; i++) {
        const bs_side_bond *bond = &side->bonds[i];
        int order = bond->says.order == BS_ORDER_DEFAULT ? 1 : bond->says.order;

        if (side->atoms[bond->a].part == part)
            st = bs_draft_add_bond(draft, number[bond->a], number[bond->b], order, NULL);
    }
    return st;
}

/* The compound that a closed part is, or NULL if its pattern wants another one. */
static bs_status make_compound(bs_ctx *cx, bs_arena *home, const bs_side *side, int part,
                               bs_mol **out)
{
    bs_mark temp = bs_arena_mark(&cx->scratch);
    bs_draft draft;
    bool fits = false;
    bs_status st;

    bs_draft_init(&draft, cx, &cx->scratch);
    if ((st = draft_part(cx, side, part, &draft)) == BS_OK)
        st = bs_draft_finish(&draft, home, NULL, out);
    if (st == BS_OK)
        st = bs_pattern_has(cx, side->patterns[part], *out, &fits);
    if (st == BS_EVALUE)
        st = BS_OK;
    if (!fits)
        *out = NULL;
    bs_arena_rewind(&cx->scratch, temp);
    return st;
}

bs_status bs_reagent__find(bs_ctx *cx, bs_arena *home, bs_case *kase)
{
    bs_status st = bs_new(cx, home, kase->source.part_count + 1, &kase->reagents);

    for (int p = 0; p < kase->source.part_count && st == BS_OK; p++) {
        if (is_closed(kase, p))
            st = make_compound(cx, home, &kase->source, p, &kase->reagents[p]);
    }
    return st;
}
