/*
 * The slants / and \ of a planned SMILES.
 *
 * Each end of a double bond with a geometry gets one slanted bond, the first as written. A slant
 * says which of the two atoms is above; that of one bond fixes the others of its double bond, and
 * of the double bonds that share a slanted bond. A slanted bond beside a double bond without
 * geometry could lend it one where its other end has a slanted bond as well: there another
 * neighbour is taken, or the hydrogen is shown and slanted.
 */
#include "format/smiles_write.h"

#include "chem/stereo.h"

#include <string.h>

enum { UNKNOWN, ABOVE, BELOW };

/* One end of a double bond or odd cumulene. */
typedef struct end {
    uint32_t atom;
    uint32_t partner;   /* index of the other end */
    uint32_t reference; /* neighbour that the geometry speaks of */
    bool trans;
    uint8_t side; /* of the reference, as seen from the end */
} end;

typedef struct slants {
    smiles_plan *plan;
    end *ends;
    uint32_t count;
    uint32_t *end_of; /* by atom: index + 1 */
    bool *slanted;    /* by bond */
    uint8_t *value;   /* by bond: where the atom written later stands */
    uint32_t *queue;  /* ends whose side is known */
    uint32_t head, tail;
} slants;

static uint8_t flip(uint8_t side)
{
    return side == UNKNOWN ? UNKNOWN : (uint8_t)(3 - side);
}

/* ---- Which bonds are slanted ---------------------------------------------------------------- */

static bs_status collect_ends(slants *s)
{
    const bs_mol *mol = s->plan->mol;
    const bs_bond *bonds = bs_mol__bonds(mol);
    uint32_t count = 0;
    bs_status st;

    for (uint32_t i = 0; i < mol->bond_count; i++)
        count += (bonds[i].flags & (BS_BOND_CIS | BS_BOND_TRANS)) != 0;
    if (count == 0)
        return BS_OK;
    if ((st = bs_new(s->plan->cx, &s->plan->cx->scratch, 2 * (size_t)count, &s->ends)) != BS_OK ||
        (st = bs_new(s->plan->cx, &s->plan->cx->scratch, 2 * (size_t)count, &s->queue)) != BS_OK)
        return st;
    for (uint32_t i = 0; i < mol->bond_count; i++) {
        bs_draft_stereo element;
        bool trans;

        if (!bs_stereo__of_bond(mol, i, &element))
            continue;
        trans = element.perm == 2;
        s->ends[s->count] = (end){element.centre, s->count + 1, element.around[0], trans, UNKNOWN};
        s->ends[s->count + 1] = (end){element.second, s->count, element.around[1], trans, UNKNOWN};
        s->end_of[element.centre] = s->count + 1;
        s->end_of[element.second] = s->count + 2;
        s->count += 2;
    }
    return BS_OK;
}

/*
 * Whether a slant on the bond to `atom` could give a geometry to a double bond that has none:
 * `atom` is one end of it, and the other end has a neighbour that will want a slant.
 */
static bool could_mislead(const slants *s, uint32_t atom)
{
    const bs_mol *mol = s->plan->mol;
    const bs_bond *bonds = bs_mol__bonds(mol);
    const bs_link *links = bs_mol__links(mol, atom);

    if (s->end_of[atom] != 0)
        return false;
    for (int k = 0; k < mol->atoms[atom].degree; k++) {
        const bs_bond *b = &bonds[links[k].bond];
        const bs_link *onward = bs_mol__links(mol, links[k].atom);

        if (b->order != 2 || (b->flags & BS_BOND_AROMATIC))
            continue;
        for (int j = 0; j < mol->atoms[links[k].atom].degree; j++) {
            if (onward[j].atom != atom && bonds[onward[j].bond].order == 1 &&
                s->end_of[onward[j].atom] != 0)
                return true;
        }
    }
    return false;
}

/* Chooses the bond to slant at one end, or shows its hydrogen. */
static void choose(slants *s, const end *e)
{
    const bs_mol *mol = s->plan->mol;
    const bs_bond *bonds = bs_mol__bonds(mol);
    const bs_link *links = smiles_plan_links(s->plan, e->atom);
    uint32_t first = UINT32_MAX;

    for (int k = 0; k < mol->atoms[e->atom].degree; k++) {
        if (bonds[links[k].bond].order != 1)
            continue;
        if (first == UINT32_MAX)
            first = links[k].bond;
        if (!could_mislead(s, links[k].atom)) {
            s->slanted[links[k].bond] = true;
            return;
        }
    }
    if (first == UINT32_MAX || mol->atoms[e->atom].hydrogens == 1)
        s->plan->hydrogen[e->atom] = '/';
    else
        s->slanted[first] = true;
}

/* ---- Which way they slant -------------------------------------------------------------------- */

/* Which side the other end of a bond is on, seen from `atom`. */
static uint8_t seen_from(const slants *s, uint32_t atom, const bs_link *link)
{
    bool later = s->plan->place[link->atom] > s->plan->place[atom];

    return later ? s->value[link->bond] : flip(s->value[link->bond]);
}

static void set_from(slants *s, uint32_t atom, const bs_link *link, uint8_t side)
{
    bool later = s->plan->place[link->atom] > s->plan->place[atom];

    s->value[link->bond] = later ? side : flip(side);
}

static void know_side(slants *s, uint32_t index, uint8_t side)
{
    if (s->ends[index].side != UNKNOWN)
        return;
    s->ends[index].side = side;
    s->queue[s->tail++] = index;
}

/* A slanted bond beside an end tells the side of that end's reference. */
static void learn_from_bond(slants *s, uint32_t atom, const bs_link *link)
{
    uint32_t index = s->end_of[atom];
    uint8_t side = seen_from(s, atom, link);

    if (index != 0)
        know_side(s, index - 1, s->ends[index - 1].reference == link->atom ? side : flip(side));
}

static bool has_double_bond(const bs_mol *mol, uint32_t atom)
{
    const bs_bond *bonds = bs_mol__bonds(mol);
    const bs_link *links = bs_mol__links(mol, atom);

    for (int k = 0; k < mol->atoms[atom].degree; k++) {
        if (bonds[links[k].bond].order == 2)
            return true;
    }
    return false;
}

/* Two slanted bonds at an atom with a double bond have to show different sides. */
static void pass_on(slants *s, uint32_t atom, const bs_link *from)
{
    const bs_mol *mol = s->plan->mol;
    const bs_link *links = bs_mol__links(mol, atom);

    if (s->end_of[atom] != 0 || !has_double_bond(mol, atom))
        return;
    for (int k = 0; k < mol->atoms[atom].degree; k++) {
        if (!s->slanted[links[k].bond] || s->value[links[k].bond] != UNKNOWN)
            continue;
        set_from(s, atom, &links[k], flip(seen_from(s, atom, from)));
        learn_from_bond(s, links[k].atom, &(bs_link){atom, links[k].bond});
    }
}

/* Spreads what is known at the ends in the queue. */
static void spread(slants *s)
{
    const bs_mol *mol = s->plan->mol;

    while (s->head < s->tail) {
        const end *e = &s->ends[s->queue[s->head++]];
        const bs_link *links = bs_mol__links(mol, e->atom);

        know_side(s, e->partner, e->trans ? flip(e->side) : e->side);
        if (s->plan->hydrogen[e->atom]) {
            uint8_t side = e->reference == BS_DRAFT_HYDROGEN ? e->side : flip(e->side);

            s->plan->hydrogen[e->atom] = side == ABOVE ? '/' : '\\';
        }
        for (int k = 0; k < mol->atoms[e->atom].degree; k++) {
            bs_link back = {e->atom, links[k].bond};

            if (!s->slanted[links[k].bond] || s->value[links[k].bond] != UNKNOWN)
                continue;
            set_from(s, e->atom, &links[k],
                     links[k].atom == e->reference ? e->side : flip(e->side));
            learn_from_bond(s, links[k].atom, &back);
            pass_on(s, links[k].atom, &back);
        }
    }
}

/* Starts from a slant whose way is free: it is written as a slash. */
static void start(slants *s, uint32_t atom, const bs_link *link)
{
    if (!s->slanted[link->bond] || s->value[link->bond] != UNKNOWN ||
        s->plan->place[link->atom] < s->plan->place[atom])
        return;
    s->value[link->bond] = ABOVE;
    learn_from_bond(s, atom, link);
    learn_from_bond(s, link->atom, &(bs_link){atom, link->bond});
    pass_on(s, atom, link);
    pass_on(s, link->atom, &(bs_link){atom, link->bond});
    spread(s);
}

static void solve(slants *s)
{
    const bs_mol *mol = s->plan->mol;

    for (uint32_t i = 0; i < mol->atom_count; i++) {
        uint32_t atom = s->plan->order[i];
        const bs_link *links = smiles_plan_links(s->plan, atom);

        if (s->plan->hydrogen[atom] && s->ends[s->end_of[atom] - 1].side == UNKNOWN) {
            uint32_t index = s->end_of[atom] - 1;

            know_side(s, index, s->ends[index].reference == BS_DRAFT_HYDROGEN ? ABOVE : BELOW);
            spread(s);
        }
        for (int k = 0; k < mol->atoms[atom].degree; k++)
            start(s, atom, &links[k]);
    }
    for (uint32_t i = 0; i < mol->bond_count; i++) {
        if (s->value[i] != UNKNOWN)
            s->plan->slants[i] = s->value[i] == ABOVE ? '/' : '\\';
    }
}

bs_status smiles_plan_slants(smiles_plan *plan)
{
    slants s = {.plan = plan};
    bs_arena *scratch = &plan->cx->scratch;
    bs_status st;

    if ((st = bs_new(plan->cx, scratch, plan->mol->atom_count, &s.end_of)) != BS_OK ||
        (st = collect_ends(&s)) != BS_OK || s.count == 0)
        return st;
    if ((st = bs_new(plan->cx, scratch, plan->mol->bond_count, &s.slanted)) != BS_OK ||
        (st = bs_new(plan->cx, scratch, plan->mol->bond_count, &s.value)) != BS_OK)
        return st;
    for (uint32_t i = 0; i < s.count; i++)
        choose(&s, &s.ends[i]);
    solve(&s);
    return BS_OK;
}
