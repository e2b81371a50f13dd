/*
 * Aromatic bonds and hydrogens after an edit.
 *
 * Hydrogens follow the valence: an atom that had a usual valence gets one again, and an atom that
 * lacked some (a radical) goes on lacking as many.
 */
#include "chem/valence.h"
#include "rule/edit.h"

/* ---- Kekulé forms --------------------------------------------------------------------------- */

static bool is_aromatic_still(const bs_edit *edit, uint32_t bond)
{
    return bond < edit->bench->bond_count && edit->bench->aromatic[bond] &&
           !(edit->bonds[bond] & BS_EDIT_BOND_CHANGED) && !edit->draft.bonds[bond].gone;
}

/*
 * Marks in `seed` the atoms whose double bonds in a ring the edit may have changed: an aromatic
 * bond of theirs, or a double bond, came or went.
 */
static void find_disturbed(const bs_edit *edit, bool *seed)
{
    const bs_draft *draft = &edit->draft;

    for (uint32_t i = 0; i < draft->bond_count; i++) {
        const bs_draft_bond *bond = &draft->bonds[i];
        bool old = i < edit->bench->bond_count;
        bool multiple = old && (edit->bench->aromatic[i] || edit->bench->bonds[i].order > 1);

        if (!(edit->bonds[i] & BS_EDIT_BOND_CHANGED))
            continue;
        if (!multiple && (bond->gone || bond->order < 2))
            continue;
        seed[bond->a] = seed[bond->b] = true;
    }
    for (uint32_t i = 0; i < draft->atom_count && edit->open_all; i++)
        seed[i] = seed[i] || (edit->atoms[i] & BS_EDIT_TOUCHED);
}

bs_status bs_edit__open_aromatic(bs_edit *edit)
{
    bs_mark temp = bs_arena_mark(&edit->cx->scratch);
    bs_draft *draft = &edit->draft;
    bool *seed;
    bool again = true;
    bs_status st = bs_new(edit->cx, &edit->cx->scratch, draft->atom_count + 1, &seed);

    if (st != BS_OK)
        return st;
    for (uint32_t i = 0; i < draft->bond_count; i++)
        edit->kekule[i] = draft->bonds[i].order;
    find_disturbed(edit, seed);
    while (again) {
        again = false;
        for (uint32_t i = 0; i < draft->bond_count; i++) {
            bs_draft_bond *bond = &draft->bonds[i];

            if ((edit->bonds[i] & BS_EDIT_BOND_OPEN) || !is_aromatic_still(edit, i) ||
                !(seed[bond->a] || seed[bond->b]))
                continue;
            bond->order = BS_DRAFT_ORDER_AROMATIC;
            edit->bonds[i] |= BS_EDIT_BOND_OPEN;
            draft->atoms[bond->a].aromatic = draft->atoms[bond->b].aromatic = true;
            seed[bond->a] = seed[bond->b] = true;
            again = true;
        }
    }
    for (uint32_t i = 0; i < draft->bond_count; i++) {
        const bs_draft_bond *bond = &draft->bonds[i];

        if (is_aromatic_still(edit, i) && !(edit->bonds[i] & BS_EDIT_BOND_OPEN) &&
            ((edit->atoms[bond->a] | edit->atoms[bond->b]) & BS_EDIT_TOUCHED))
            edit->can_open = true;
    }
    bs_arena_rewind(&edit->cx->scratch, temp);
    return BS_OK;
}

/* ---- Counting ----------------------------------------------------------------------------------
 */

/* The bonds of an atom after the edit. */
typedef struct tally {
    int sum;     /* of orders; opened bonds with their old ones, fresh aromatic ones as 1 */
    int doubles; /* bonds of order 2 or more that are not aromatic */
    int sigma;   /* bonds */
    bool fresh;  /* aromatic by the rule */
    bool lost;   /* an aromatic bond went or became another one */
    bool open;   /* has an opened aromatic bond */
} tally;

static void count_end(const bs_edit *edit, uint32_t index, tally *t)
{
    const bs_draft_bond *bond = &edit->draft.bonds[index];
    bool old = index < edit->bench->bond_count && edit->bench->aromatic[index];
    unsigned flags = edit->bonds[index];

    t->lost = t->lost || (old && (flags & BS_EDIT_BOND_CHANGED));
    if (bond->gone)
        return;
    t->sigma++;
    t->fresh = t->fresh || (flags & BS_EDIT_BOND_FRESH);
    t->open = t->open || (flags & BS_EDIT_BOND_OPEN);
    if (flags & BS_EDIT_BOND_FRESH) {
        t->sum++;
        return;
    }
    t->sum += edit->kekule[index];
    if (!(flags & BS_EDIT_BOND_OPEN) && !is_aromatic_still(edit, index))
        t->doubles += edit->kekule[index] > 1;
}

/* An atom that came into an aromatic ring, or lost some of one and stays in the rest. */
static int ring_hydrogens(const bs_draft_atom *atom, const tally *t)
{
    int used = t->sigma + (t->doubles ? t->doubles : 1);

    if (atom->element == 7 || atom->element == 8 || atom->element == 15 || atom->element == 16)
        return 0;
    return used < 4 ? bs_valence__implied(atom->element, atom->charge, used) : 0;
}

static int chain_hydrogens(const bs_draft_atom *atom, const bs_atom *was, const tally *t)
{
    const uint8_t *usual = bs_valence__normal(was->element, was->charge);
    int missing = 0, hydrogens;

    if (*bs_valence__normal(atom->element, atom->charge) == 0)
        return was->element == atom->element && *usual == 0 ? was->hydrogens : 0;
    while (*usual && *usual < was->valence)
        usual++;
    if (*usual)
        missing = *usual - was->valence;
    hydrogens = bs_valence__implied(atom->element, atom->charge, t->sum) - missing;
    return hydrogens > 0 ? hydrogens : 0;
}

/* The number that the rule writes for the hydrogens of an atom, as a test or not. */
static int hint_for(const bs_edit *edit, uint32_t atom)
{
    const bs_reading *r = edit->bench->reading;

    for (int i = 0; i < r->atom_edits; i++) {
        if (edit->slot[r->atoms[i].slot] == atom)
            return r->atoms[i].hydrogen_hint;
    }
    return BS_UNSAID;
}

static void count_atom(bs_edit *edit, uint32_t index, const tally *t)
{
    bs_draft_atom *atom = &edit->draft.atoms[index];
    bool ring = t->fresh || (t->open && (t->lost || (edit->atoms[index] & BS_EDIT_RING)));
    int hint = BS_UNSAID;

    if (atom->gone)
        return;
    if (ring && atom->element == 7 && t->sigma == 2 && atom->charge == 0) {
        bool stated = (edit->atoms[index] & BS_EDIT_STATED) && atom->hydrogens >= 0;

        hint = stated ? atom->hydrogens : hint_for(edit, index);
        if (hint == BS_UNSAID && edit->fresh_nitrogens++ == edit->extra_hydrogen)
            hint = 1;
        if (hint != BS_UNSAID)
            atom->hydrogens = (int16_t)hint;
        if (hint != BS_UNSAID || (edit->atoms[index] & BS_EDIT_CREATED))
            return;
    }
    if ((edit->atoms[index] & BS_EDIT_STATED) || !(edit->atoms[index] & BS_EDIT_TOUCHED))
        return;
    atom->hydrogens = (int16_t)(ring ? ring_hydrogens(atom, t)
                                     : chain_hydrogens(atom, edit->bench->origin[index], t));
}

bs_status bs_edit__count_hydrogens(bs_edit *edit)
{
    bs_mark temp = bs_arena_mark(&edit->cx->scratch);
    const bs_draft *draft = &edit->draft;
    const unsigned touched = BS_EDIT_TOUCHED | BS_EDIT_CREATED;
    tally *tallies;
    bs_status st = bs_new(edit->cx, &edit->cx->scratch, draft->atom_count + 1, &tallies);

    if (st != BS_OK)
        return st;
    /* Nothing changes at an atom that the edit has not touched. */
    for (uint32_t i = 0; i < draft->bond_count; i++) {
        uint32_t a = draft->bonds[i].a, b = draft->bonds[i].b;

        if (edit->atoms[a] & touched)
            count_end(edit, i, &tallies[a]);
        if (edit->atoms[b] & touched)
            count_end(edit, i, &tallies[b]);
    }
    for (uint32_t i = 0; i < draft->atom_count; i++) {
        if (edit->atoms[i] & touched)
            count_atom(edit, i, &tallies[i]);
    }
    bs_arena_rewind(&edit->cx->scratch, temp);
    return BS_OK;
}
