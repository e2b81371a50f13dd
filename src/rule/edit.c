/*
 * Applying a reading: a copy of the reactants' draft is edited, finished, and cut into products.
 *
 * Reactants come with a Kekulé form. Where an edit disturbs an aromatic system, its bonds are
 * opened (their orders are found anew when the draft is finished), so that it does not matter
 * which of the forms was drawn.
 */
#include "rule/edit.h"

#include <string.h>

#include "chem/draft.h"

/* ---- The bench ---------------------------------------------------------------------------- */

static bs_status count_molecules(bs_ctx *cx, bs_arena *home, bs_bench *bench)
{
    int parts = bench->reading->from->part_count;
    bs_status st;

    if ((st = bs_new(cx, home, parts + 1, &bench->base)) != BS_OK ||
        (st = bs_new(cx, home, parts + 1, &bench->bond_base)) != BS_OK)
        return st;
    for (int i = 0; i < parts; i++) {
        bench->base[i + 1] = bench->base[i] + bench->mols[i]->atom_count;
        bench->bond_base[i + 1] = bench->bond_base[i] + bench->mols[i]->bond_count;
    }
    bench->atom_count = bench->base[parts];
    bench->bond_count = bench->bond_base[parts];
    if ((st = bs_new(cx, home, bench->atom_count, &bench->atoms)) != BS_OK ||
        (st = bs_new(cx, home, bench->bond_count, &bench->bonds)) != BS_OK ||
        (st = bs_new(cx, home, bench->atom_count + bench->bond_count, &bench->stereo)) != BS_OK ||
        (st = bs_new(cx, home, bench->bond_count, &bench->aromatic)) != BS_OK)
        return st;
    return bs_new(cx, home, bench->atom_count, &bench->origin);
}

static void lay_molecule(bs_bench *bench, int part, const bs_draft *draft)
{
    const bs_mol *mol = bench->mols[part];
    const bs_bond *bonds = bs_mol__bonds(mol);
    uint32_t base = bench->base[part], bond_base = bench->bond_base[part];

    for (uint32_t i = 0; i < draft->atom_count; i++) {
        bench->atoms[base + i] = draft->atoms[i];
        bench->origin[base + i] = &mol->atoms[i];
    }
    for (uint32_t i = 0; i < draft->bond_count; i++) {
        bs_draft_bond bond = draft->bonds[i];

        bond.a += base;
        bond.b += base;
        bench->bonds[bond_base + i] = bond;
        bench->aromatic[bond_base + i] = (bonds[i].flags & BS_BOND_AROMATIC) != 0;
    }
    for (uint32_t i = 0; i < draft->stereo_count; i++) {
        bs_draft_stereo element = draft->stereo[i];

        element.centre += base;
        element.second += base;
        for (int k = 0; k < 6; k++) {
            if (element.around[k] != BS_DRAFT_HYDROGEN)
                element.around[k] += base;
        }
        bench->stereo[bench->stereo_count++] = element;
    }
}

bs_status bs_bench__lay(bs_ctx *cx, bs_arena *home, const bs_reading *reading,
                        const bs_mol *const *mols, bs_bench *out)
{
    bs_status st;

    *out = (bs_bench){.reading = reading, .mols = mols};
    if ((st = count_molecules(cx, home, out)) != BS_OK)
        return st;
    for (int i = 0; i < reading->from->part_count && st == BS_OK; i++) {
        bs_draft draft;

        bs_draft_init(&draft, cx, home);
        if ((st = bs_draft_from_mol(&draft, mols[i])) == BS_OK)
            lay_molecule(out, i, &draft);
    }
    return st;
}

/* ---- A working copy ------------------------------------------------------------------------- */

static bs_status copy_bench(bs_edit *edit)
{
    const bs_bench *bench = edit->bench;
    const bs_reading *r = bench->reading;
    bs_arena *scratch = &edit->cx->scratch;
    uint32_t atoms = bench->atom_count + (uint32_t)r->slot_count;
    uint32_t bonds = bench->bond_count + (uint32_t)r->bond_edits;
    uint32_t stereo = bench->stereo_count + (uint32_t)(r->hand_edits + r->slope_edits);
    bs_draft *draft = &edit->draft;
    bs_status st;

    bs_draft_init(draft, edit->cx, scratch);
    if ((st = bs_new(edit->cx, scratch, atoms + 1, &draft->atoms)) != BS_OK ||
        (st = bs_new(edit->cx, scratch, bonds + 1, &draft->bonds)) != BS_OK ||
        (st = bs_new(edit->cx, scratch, stereo + 1, &draft->stereo)) != BS_OK ||
        (st = bs_new(edit->cx, scratch, atoms + 1, &edit->atoms)) != BS_OK ||
        (st = bs_new(edit->cx, scratch, bonds + 1, &edit->bonds)) != BS_OK ||
        (st = bs_new(edit->cx, scratch, bonds + 1, &edit->kekule)) != BS_OK ||
        (st = bs_new(edit->cx, scratch, r->slot_count + 1, &edit->slot)) != BS_OK)
        return st;
    draft->atom_room = atoms + 1;
    draft->bond_room = bonds + 1;
    draft->stereo_room = stereo + 1;
    if (bench->atom_count > 0)
        memcpy(draft->atoms, bench->atoms, bench->atom_count * sizeof *draft->atoms);
    if (bench->bond_count > 0)
        memcpy(draft->bonds, bench->bonds, bench->bond_count * sizeof *draft->bonds);
    if (bench->stereo_count > 0)
        memcpy(draft->stereo, bench->stereo, bench->stereo_count * sizeof *draft->stereo);
    draft->atom_count = bench->atom_count;
    draft->bond_count = bench->bond_count;
    draft->stereo_count = bench->stereo_count;
    return BS_OK;
}

static void place_slots(bs_edit *edit, const uint32_t *where)
{
    const bs_side *from = edit->bench->reading->from;

    for (int i = 0; i < from->atom_count; i++)
        edit->slot[i] = edit->bench->base[from->atoms[i].part] + where[i];
}

/* ---- Atoms ------------------------------------------------------------------------------------
 */

/* Hydrogens are written as all of them; those that are atoms count. */
static int hydrogen_atoms(const bs_edit *edit, uint32_t atom)
{
    const bs_draft *draft = &edit->draft;
    int count = 0;

    for (uint32_t i = 0; i < draft->bond_count; i++) {
        const bs_draft_bond *bond = &draft->bonds[i];

        if (bond->gone || (bond->a != atom && bond->b != atom))
            continue;
        count += draft->atoms[bond->a == atom ? bond->b : bond->a].element == 1;
    }
    return count;
}

static void change_atom(bs_edit *edit, const bs_atom_edit *change)
{
    uint32_t index = edit->slot[change->slot];
    bs_draft_atom *atom = &edit->draft.atoms[index];

    if (change->element != BS_UNSAID && change->element != atom->element) {
        atom->element = (uint8_t)change->element;
        edit->atoms[index] |= BS_EDIT_TOUCHED;
    }
    if (change->charge != BS_UNSAID && change->charge != atom->charge) {
        atom->charge = (int8_t)change->charge;
        edit->atoms[index] |= BS_EDIT_TOUCHED;
    }
    if (change->stays_aromatic)
        edit->atoms[index] |= BS_EDIT_RING;
    if (change->recount)
        edit->atoms[index] |= BS_EDIT_TOUCHED;
    if (change->isotope != BS_UNSAID)
        atom->isotope = (uint16_t)change->isotope;
    if (change->hydrogens != BS_UNSAID) {
        int folded = change->hydrogens - hydrogen_atoms(edit, index);

        atom->hydrogens = (int16_t)(folded > 0 ? folded : 0);
        edit->atoms[index] |= BS_EDIT_STATED | BS_EDIT_TOUCHED;
    }
}

static bs_status create_atoms(bs_edit *edit)
{
    const bs_reading *r = edit->bench->reading;
    bs_status st = BS_OK;

    for (int i = 0; i < r->atom_edits && st == BS_OK; i++) {
        const bs_atom_edit *e = &r->atoms[i];
        bs_draft_atom atom = {.element = (uint8_t)e->element,
                              .charge = (int8_t)e->charge,
                              .isotope = (uint16_t)e->isotope,
                              .aromatic = e->aromatic == 1,
                              .hydrogens = BS_DRAFT_IMPLIED};

        if (!e->created)
            continue;
        if (e->hydrogens != BS_UNSAID)
            atom.hydrogens = (int16_t)e->hydrogens;
        if ((st = bs_draft_add_atom(&edit->draft, atom, &edit->slot[e->slot])) == BS_OK)
            edit->atoms[edit->slot[e->slot]] |= BS_EDIT_CREATED | BS_EDIT_STATED;
    }
    return st;
}

static void change_atoms(bs_edit *edit)
{
    const bs_reading *r = edit->bench->reading;

    for (int i = 0; i < r->atom_edits; i++) {
        if (!r->atoms[i].created)
            change_atom(edit, &r->atoms[i]);
    }
}

static void remove_atoms(bs_edit *edit)
{
    const bs_reading *r = edit->bench->reading;
    bs_draft *draft = &edit->draft;

    for (int i = 0; i < r->from->atom_count; i++) {
        if (r->from_to[i] < 0)
            draft->atoms[edit->slot[i]].gone = true;
    }
    for (uint32_t i = 0; i < draft->bond_count; i++) {
        bs_draft_bond *bond = &draft->bonds[i];

        if (bond->gone || (!draft->atoms[bond->a].gone && !draft->atoms[bond->b].gone))
            continue;
        bond->gone = true;
        edit->bonds[i] |= BS_EDIT_BOND_CHANGED;
        edit->atoms[bond->a] |= BS_EDIT_TOUCHED;
        edit->atoms[bond->b] |= BS_EDIT_TOUCHED;
    }
}

/* ---- Bonds ------------------------------------------------------------------------------------
 */

static bs_draft_bond *find_bond(bs_edit *edit, uint32_t a, uint32_t b)
{
    for (uint32_t i = 0; i < edit->draft.bond_count; i++) {
        bs_draft_bond *bond = &edit->draft.bonds[i];

        if (!bond->gone && ((bond->a == a && bond->b == b) || (bond->a == b && bond->b == a)))
            return bond;
    }
    return NULL;
}

static void touch_bond(bs_edit *edit, uint32_t index, bool fresh)
{
    const bs_draft_bond *bond = &edit->draft.bonds[index];

    edit->bonds[index] |= BS_EDIT_BOND_CHANGED;
    if (fresh) {
        edit->bonds[index] |= BS_EDIT_BOND_FRESH;
        edit->draft.atoms[bond->a].aromatic = edit->draft.atoms[bond->b].aromatic = true;
    }
    edit->atoms[bond->a] |= BS_EDIT_TOUCHED;
    edit->atoms[bond->b] |= BS_EDIT_TOUCHED;
}

static bs_status change_bond(bs_edit *edit, const bs_bond_edit *change)
{
    uint32_t a = edit->slot[change->x], b = edit->slot[change->y];
    bs_draft_bond *bond = find_bond(edit, a, b);
    bool fresh = change->order == BS_DRAFT_ORDER_AROMATIC;
    uint32_t index;
    bool was_aromatic;

    if (!bond) {
        bs_status st;

        if (change->order == 0)
            return BS_OK;
        if ((st = bs_draft_add_bond(&edit->draft, a, b, change->order, &index)) == BS_OK)
            touch_bond(edit, index, fresh);
        return st;
    }
    index = (uint32_t)(bond - edit->draft.bonds);
    was_aromatic = index < edit->bench->bond_count && edit->bench->aromatic[index];
    if (fresh ? was_aromatic : !was_aromatic && bond->order == change->order)
        return BS_OK;
    if (change->order == 0)
        bond->gone = true;
    else
        bond->order = (uint8_t)change->order;
    touch_bond(edit, index, fresh);
    return BS_OK;
}

static bs_status change_bonds(bs_edit *edit)
{
    const bs_reading *r = edit->bench->reading;
    bs_status st = BS_OK;

    for (int i = 0; i < r->bond_edits && st == BS_OK; i++)
        st = change_bond(edit, &r->bonds[i]);
    return st;
}

/* ---- What stays -------------------------------------------------------------------------------
 */

static uint32_t root_of(uint32_t *parent, uint32_t atom)
{
    while (parent[atom] != atom)
        atom = parent[atom] = parent[parent[atom]];
    return atom;
}

/*
 * Removes what no atom of `to` holds, and checks that each part of `to` is one molecule and no
 * molecule two parts. `parent` gets a union-find forest of the draft's pieces.
 */
static bs_status keep_products(bs_edit *edit, uint32_t *parent, bool *possible)
{
    const bs_reading *r = edit->bench->reading;
    bs_draft *draft = &edit->draft;
    uint32_t *part_root;
    int *owner; /* for each root the part that it belongs to, plus 1 */
    bs_status st;

    if ((st = bs_new(edit->cx, &edit->cx->scratch, r->to->part_count + 1, &part_root)) != BS_OK ||
        (st = bs_new(edit->cx, &edit->cx->scratch, draft->atom_count + 1, &owner)) != BS_OK)
        return st;
    for (uint32_t i = 0; i < draft->atom_count; i++)
        parent[i] = i;
    for (uint32_t i = 0; i < draft->bond_count; i++) {
        const bs_draft_bond *bond = &draft->bonds[i];

        if (!bond->gone)
            parent[root_of(parent, bond->a)] = root_of(parent, bond->b);
    }
    *possible = true;
    for (int i = 0; i < r->to->atom_count; i++) {
        int part = r->to->atoms[i].part + 1;
        uint32_t root = root_of(parent, edit->slot[r->to_slot[i]]);

        if ((owner[root] != 0 && owner[root] != part) ||
            (part_root[part - 1] != 0 && part_root[part - 1] != root + 1))
            *possible = false;
        owner[root] = part;
        part_root[part - 1] = root + 1;
    }
    for (uint32_t i = 0; i < draft->atom_count; i++)
        draft->atoms[i].gone = draft->atoms[i].gone || owner[root_of(parent, i)] == 0;
    return BS_OK;
}

/* ---- Products ---------------------------------------------------------------------------------
 */

/* Whether all atoms that the edit touched have valences that chemists know. */
static bool valences_pass(const bs_edit *edit, const uint32_t *order, const bs_mol *mol)
{
    for (uint32_t i = 0; i < edit->draft.atom_count; i++) {
        if (order[i] == UINT32_MAX || !(edit->atoms[i] & (BS_EDIT_TOUCHED | BS_EDIT_CREATED)))
            continue;
        if (!(mol->atoms[order[i]].flags & BS_ATOM_ODD))
            continue;
        if (i < edit->bench->atom_count && (edit->bench->origin[i]->flags & BS_ATOM_ODD))
            continue;
        return false;
    }
    return true;
}

/* The products in the order of the parts: pieces come in the order of their first atoms. */
static bs_status sort_products(bs_edit *edit, bs_arena *home, uint32_t *parent,
                               const uint32_t *order, bs_mol **pieces, int piece_count,
                               bs_result *out)
{
    const bs_reading *r = edit->bench->reading;
    bs_arena *scratch = &edit->cx->scratch;
    uint32_t *number, *size, *local;
    uint32_t next = 0;
    bs_status st;

    if ((st = bs_new(edit->cx, home, r->to->part_count + 1, &out->products)) != BS_OK ||
        (st = bs_new(edit->cx, home, r->to->atom_count + 1, &out->spots)) != BS_OK ||
        (st = bs_new(edit->cx, scratch, edit->draft.atom_count + 1, &number)) != BS_OK ||
        (st = bs_new(edit->cx, scratch, edit->draft.atom_count + 1, &size)) != BS_OK ||
        (st = bs_new(edit->cx, scratch, edit->draft.atom_count + 1, &local)) != BS_OK)
        return st;
    for (uint32_t i = 0; i < edit->draft.atom_count; i++) {
        uint32_t root = root_of(parent, i);

        if (order[i] == UINT32_MAX)
            continue;
        if (size[root] == 0)
            number[root] = next++;
        local[i] = size[root]++;
    }
    out->product_count = r->to->part_count;
    for (int i = 0; i < r->to->atom_count; i++) {
        uint32_t atom = edit->slot[r->to_slot[i]];
        uint32_t piece = number[root_of(parent, atom)];

        out->spots[i] = (bs_spot){(uint32_t)r->to->atoms[i].part, local[atom]};
        if (order[atom] == UINT32_MAX)
            out->spots[i].atom = BS_NOWHERE;
        if ((int)piece < piece_count)
            out->products[r->to->atoms[i].part] = pieces[piece];
    }
    return BS_OK;
}

static bs_status finish_products(bs_edit *edit, bs_arena *home, uint32_t *parent, bs_result *out,
                                 bool *possible)
{
    uint32_t *order;
    bs_mol *whole;
    bs_mol **pieces;
    int count = 1;
    bool cut = edit->bench->reading->to->part_count > 1;
    bs_status st = cut ? bs_draft__finish_plain(&edit->draft, &edit->cx->scratch, &order, &whole)
                       : bs_draft_finish(&edit->draft, &edit->cx->scratch, &order, &whole);

    *possible = false;
    if (st == BS_EVALUE)
        return BS_OK;
    if (st != BS_OK || !valences_pass(edit, order, whole))
        return st;
    if (cut) {
        st = bs_mol_fragments(edit->cx, home, whole, &pieces, &count);
    } else {
        pieces = &whole;
        st = bs_mol_copy(edit->cx, home, whole, &whole);
    }
    if (st != BS_OK)
        return st;
    *possible = count == edit->bench->reading->to->part_count;
    return *possible ? sort_products(edit, home, parent, order, pieces, count, out) : BS_OK;
}

/* ---- All together -------------------------------------------------------------------------------
 */

static bs_status attempt(bs_edit *edit, bs_arena *home, const uint32_t *where, bs_result *out,
                         bool *possible)
{
    const bs_reading *r = edit->bench->reading;
    uint32_t *parent;
    bs_status st;

    *possible = false;
    if ((st = copy_bench(edit)) != BS_OK)
        return st;
    place_slots(edit, where);
    remove_atoms(edit);
    if ((st = create_atoms(edit)) != BS_OK || (st = change_bonds(edit)) != BS_OK)
        return st;
    change_atoms(edit);
    if ((st = bs_new(edit->cx, &edit->cx->scratch, edit->draft.atom_count + 1, &parent)) != BS_OK ||
        (st = keep_products(edit, parent, possible)) != BS_OK || !*possible)
        return st;
    for (int i = 0; i < r->to->atom_count; i++)
        edit->atoms[edit->slot[r->to_slot[i]]] |= BS_EDIT_SEED;
    if ((st = bs_edit__open_aromatic(edit)) != BS_OK ||
        (st = bs_edit__count_hydrogens(edit)) != BS_OK ||
        (st = bs_edit__move_stereo(edit)) != BS_OK)
        return st;
    if (edit->barred) {
        *possible = false;
        return BS_OK;
    }
    return finish_products(edit, home, parent, out, possible);
}

/*
 * Tries the plain edit first, then with all touched aromatic systems opened, then with a hydrogen
 * on one of the new aromatic nitrogens (a rule that writes `n` for a pyrrole's nitrogen).
 */
bs_status bs_bench__apply(bs_ctx *cx, bs_arena *home, const bs_bench *bench, const uint32_t *where,
                          bs_result *out, bool *possible)
{
    bs_mark kept = bs_arena_mark(home);
    int tries = 1;
    bs_status st = BS_OK;

    *possible = false;
    for (int i = 0; i < tries && st == BS_OK && !*possible; i++) {
        bs_mark temp = bs_arena_mark(&cx->scratch);
        bs_edit edit = {.cx = cx, .bench = bench, .open_all = i > 0, .extra_hydrogen = i - 2};

        bs_arena_rewind(home, kept);
        *out = (bs_result){0};
        st = attempt(&edit, home, where, out, possible);
        if (i == 0 && (edit.can_open || edit.fresh_nitrogens > 0))
            tries = 2 + (edit.fresh_nitrogens < 6 ? edit.fresh_nitrogens : 6);
        bs_arena_rewind(&cx->scratch, temp);
    }
    if (st != BS_OK || !*possible)
        bs_arena_rewind(home, kept);
    return st;
}
