/*
 * Finishing a draft: from atoms and bonds as they were written to a perceived molecule.
 *
 * The molecule is put together in the scratch arena, perceived there and copied to its home with
 * its rings.
 */
#include "chem/canon.h"
#include "chem/draft.h"
#include "chem/features.h"
#include "chem/ring.h"
#include "chem/spelling.h"
#include "chem/valence.h"

#include <string.h>

/* SMILES has one digit for them; [ReH9-2] is the record. */
enum { MOST_HYDROGENS = 9 };

typedef struct finish {
    bs_ctx *cx;
    const bs_draft *draft;
    uint32_t *order;  /* draft atom to atom */
    uint32_t *origin; /* atom to draft atom */
    bs_mol *mol;
    int16_t *stated; /* by atom: stated hydrogens or BS_DRAFT_IMPLIED */
    bool *wish;      /* by atom: written as aromatic */
    bs_rings rings;
    bool plain; /* leave the features out */
} finish;

static bool bond_stands(const bs_draft *draft, const bs_draft_bond *bond)
{
    return !bond->gone && !draft->atoms[bond->a].gone && !draft->atoms[bond->b].gone;
}

/* ---- Which atoms stay ---------------------------------------------------------------------- */

static bs_status check_bonds(finish *f)
{
    for (uint32_t i = 0; i < f->draft->bond_count; i++) {
        const bs_draft_bond *b = &f->draft->bonds[i];

        if (b->a >= f->draft->atom_count || b->b >= f->draft->atom_count)
            return bs_fail(f->cx, BS_EBUG, "a bond to an atom that is not there");
        if (bond_stands(f->draft, b) && b->a == b->b)
            return bs_fail_at(f->cx, BS_EVALUE, b->a, "an atom cannot be bonded to itself");
    }
    return BS_OK;
}

static bool is_plain_hydrogen(const bs_draft_atom *a)
{
    return a->element == 1 && a->isotope == 0 && a->charge == 0 && a->label == 0 &&
           a->hydrogens <= 0;
}

/*
 * Finds the hydrogens to fold. `host` gets for each draft atom its neighbour if it is to be folded
 * there, else UINT32_MAX; `degree` is working memory.
 */
static void find_folded(const bs_draft *draft, uint32_t *host, uint32_t *degree)
{
    memset(host, 0xff, draft->atom_count * sizeof *host);
    for (uint32_t i = 0; i < draft->bond_count; i++) {
        const bs_draft_bond *b = &draft->bonds[i];

        if (!bond_stands(draft, b))
            continue;
        degree[b->a]++;
        degree[b->b]++;
        if (b->order <= 1 || b->order == BS_DRAFT_ORDER_AROMATIC) {
            host[b->a] = b->b;
            host[b->b] = b->a;
        }
    }
    for (uint32_t i = 0; i < draft->atom_count; i++) {
        const bs_draft_atom *a = &draft->atoms[i];

        if (!is_plain_hydrogen(a) || degree[i] != 1 ||
            (host[i] != UINT32_MAX && draft->atoms[host[i]].element == 1))
            host[i] = UINT32_MAX;
    }
}

/* ---- The block ------------------------------------------------------------------------------ */

static void place_atoms(finish *f)
{
    uint32_t next = 0;

    for (uint32_t i = 0; i < f->draft->atom_count; i++) {
        const bs_draft_atom *a = &f->draft->atoms[i];

        if (f->order[i] == UINT32_MAX)
            continue;
        f->origin[next] = i;
        f->stated[next] = a->hydrogens;
        f->wish[next] = a->aromatic;
        f->mol->atoms[next] = (bs_atom){.element = a->element,
                                        .charge = a->charge,
                                        .hydrogens = (uint8_t)(a->hydrogens > 0 ? a->hydrogens : 0),
                                        .isotope = a->isotope,
                                        .label = a->label};
        f->mol->charge += a->charge;
        next++;
    }
}

static bs_status add_folded(finish *f, const uint32_t *host)
{
    for (uint32_t i = 0; i < f->draft->atom_count; i++) {
        bs_atom *a;

        if (f->draft->atoms[i].gone || host[i] == UINT32_MAX)
            continue;
        a = &f->mol->atoms[f->order[host[i]]];
        if (a->hydrogens == UINT8_MAX)
            return bs_fail_at(f->cx, BS_ELIMIT, host[i], "an atom has at most 255 hydrogens");
        a->hydrogens++;
    }
    return BS_OK;
}

static void place_bonds(finish *f)
{
    bs_bond *bonds = bs_mol__bonds_mutable(f->mol);
    uint32_t next = 0;

    for (uint32_t i = 0; i < f->draft->bond_count; i++) {
        const bs_draft_bond *b = &f->draft->bonds[i];
        uint32_t a;
        uint32_t c;

        if (!bond_stands(f->draft, b))
            continue;
        a = f->order[b->a];
        c = f->order[b->b];
        if (a == UINT32_MAX || c == UINT32_MAX)
            continue;
        bonds[next].a = a & 0xffffff;
        bonds[next].b = c & 0xffffff;
        bonds[next++].order = b->order;
    }
}

static bs_status link_atoms(finish *f)
{
    const bs_bond *bonds = bs_mol__bonds(f->mol);
    uint32_t *offsets = (uint32_t *)(void *)((char *)f->mol + f->mol->offsets_at);
    bs_link *links = (bs_link *)(void *)((char *)f->mol + f->mol->links_at);
    uint32_t *degree;
    bs_status st = bs_new(f->cx, &f->cx->scratch, f->mol->atom_count, &degree);

    if (st != BS_OK)
        return st;
    for (uint32_t i = 0; i < f->mol->bond_count; i++) {
        degree[bonds[i].a]++;
        degree[bonds[i].b]++;
    }
    for (uint32_t i = 0; i < f->mol->atom_count; i++) {
        if (degree[i] > UINT8_MAX)
            return bs_fail_at(f->cx, BS_ELIMIT, f->origin[i], "an atom has at most 255 bonds");
        offsets[i + 1] = offsets[i] + degree[i];
    }
    for (uint32_t i = 0; i < f->mol->bond_count; i++) {
        uint32_t a = bonds[i].a;
        uint32_t b = bonds[i].b;

        links[offsets[a] + f->mol->atoms[a].degree++] = (bs_link){b, i};
        links[offsets[b] + f->mol->atoms[b].degree++] = (bs_link){a, i};
    }
    return BS_OK;
}

/* Refuses two bonds between the same atoms. */
static bs_status check_doubled(finish *f)
{
    uint32_t *seen;
    bs_status st = bs_new(f->cx, &f->cx->scratch, f->mol->atom_count, &seen);

    for (uint32_t i = 0; i < f->mol->atom_count && st == BS_OK; i++) {
        const bs_link *links = bs_mol__links(f->mol, i);

        for (int k = 0; k < f->mol->atoms[i].degree && st == BS_OK; k++) {
            if (seen[links[k].atom] == i + 1)
                st = bs_fail_at(f->cx, BS_EVALUE, f->origin[links[k].atom],
                                "two bonds between the same two atoms");
            seen[links[k].atom] = i + 1;
        }
    }
    return st;
}

/* Puts the molecule together as it was written, in the scratch arena. */
static bs_status assemble(finish *f)
{
    const bs_draft *draft = f->draft;
    bs_arena *scratch = &f->cx->scratch;
    uint32_t atoms = 0;
    uint32_t bonds = 0;
    uint32_t *host;
    uint32_t *degree;
    bs_status st;

    if ((st = check_bonds(f)) != BS_OK ||
        (st = bs_new(f->cx, scratch, draft->atom_count, &host)) != BS_OK ||
        (st = bs_new(f->cx, scratch, draft->atom_count, &degree)) != BS_OK)
        return st;
    find_folded(draft, host, degree);
    for (uint32_t i = 0; i < draft->atom_count; i++)
        f->order[i] = draft->atoms[i].gone || host[i] != UINT32_MAX ? UINT32_MAX : atoms++;
    for (uint32_t i = 0; i < draft->bond_count; i++) {
        const bs_draft_bond *b = &draft->bonds[i];

        bonds += bond_stands(draft, b) && host[b->a] == UINT32_MAX && host[b->b] == UINT32_MAX;
    }
    if ((st = bs_mol__new(f->cx, scratch, atoms, bonds, 0, 0, &f->mol)) != BS_OK ||
        (st = bs_new(f->cx, scratch, atoms, &f->origin)) != BS_OK ||
        (st = bs_new(f->cx, scratch, atoms, &f->stated)) != BS_OK ||
        (st = bs_new(f->cx, scratch, atoms, &f->wish)) != BS_OK)
        return st;
    place_atoms(f);
    if ((st = add_folded(f, host)) != BS_OK)
        return st;
    place_bonds(f);
    if ((st = link_atoms(f)) != BS_OK)
        return st;
    return check_doubled(f);
}

/* ---- Valence -------------------------------------------------------------------------------- */

/* Coordinate bonds of an atom, which SMILES writes as single ones. */
static int coordinate_bonds(const bs_mol *mol, uint32_t atom)
{
    const bs_bond *bonds = bs_mol__bonds(mol);
    const bs_link *links = bs_mol__links(mol, atom);
    int count = 0;

    for (int k = 0; k < mol->atoms[atom].degree; k++)
        count += bonds[links[k].bond].order == 0;
    return count;
}

static bs_status fill_valences(finish *f)
{
    bs_spelling__unify(f->mol, f->stated);
    for (uint32_t i = 0; i < f->mol->atom_count; i++) {
        bs_atom *a = &f->mol->atoms[i];
        int sum = bs_spelling__bond_sum(f->mol, i);
        int total;

        if (a->element == 1 && a->hydrogens > 0)
            return bs_fail_at(f->cx, BS_EVALUE, f->origin[i],
                              "a hydrogen cannot have a hydrogen count");
        if (f->stated[i] == BS_DRAFT_IMPLIED && a->element != 1)
            a->hydrogens = (uint8_t)(a->hydrogens + bs_valence__implied(a->element, a->charge,
                                                                        sum + a->hydrogens));
        if (a->hydrogens > MOST_HYDROGENS)
            return bs_fail_at(f->cx, BS_EVALUE, f->origin[i], "an atom has at most %d hydrogens",
                              MOST_HYDROGENS);
        total = sum + a->hydrogens;
        if (total > UINT8_MAX)
            return bs_fail_at(f->cx, BS_ELIMIT, f->origin[i], "a valence is at most 255");
        a->valence = (uint8_t)total;
        sum += coordinate_bonds(f->mol, i);
        if (a->hydrogens != bs_valence__implied(a->element, a->charge, sum))
            a->flags |= BS_ATOM_BRACKET;
        if (!bs_valence__is_usual(a->element, a->charge, total))
            a->flags |= BS_ATOM_ODD;
    }
    return BS_OK;
}

/* ---- Rings ------------------------------------------------------------------------------------
 */

/* Counts of rings for each atom. */
static void count_rings(finish *f)
{
    const bs_bond *bonds = bs_mol__bonds(f->mol);

    for (uint32_t i = 0; i < f->mol->bond_count; i++) {
        if (!(bonds[i].flags & BS_BOND_RING))
            continue;
        f->mol->atoms[bonds[i].a].ring_bonds++;
        f->mol->atoms[bonds[i].b].ring_bonds++;
    }
    for (uint32_t r = 0; r < f->rings.sssr; r++) {
        uint32_t size = f->rings.offsets[r + 1] - f->rings.offsets[r];

        for (uint32_t k = f->rings.offsets[r]; k < f->rings.offsets[r + 1]; k++) {
            bs_atom *a = &f->mol->atoms[f->rings.atoms[k]];

            if (a->ring_count < UINT8_MAX)
                a->ring_count++;
            if (a->min_ring == 0 || size < a->min_ring)
                a->min_ring = size > UINT16_MAX ? UINT16_MAX : (uint16_t)size;
        }
    }
}

/* Copies the perceived molecule to its home and puts the rings behind. */
static bs_status pack(finish *f, bs_arena *home, bs_mol **out)
{
    uint32_t rings = f->rings.sssr;
    uint32_t ring_atoms = rings ? f->rings.offsets[rings] : 0;
    bs_mol *mol;
    bs_status st =
        bs_mol__new(f->cx, home, f->mol->atom_count, f->mol->bond_count, rings, ring_atoms, &mol);

    if (st != BS_OK)
        return st;
    mol->charge = f->mol->charge;
    memcpy(mol->atoms, f->mol->atoms, f->mol->rings_at - sizeof *mol);
    if (rings > 0) {
        memcpy((char *)mol + mol->rings_at, f->rings.offsets, (rings + 1) * sizeof(uint32_t));
        memcpy((char *)mol + mol->ring_atoms_at, f->rings.atoms, ring_atoms * sizeof(uint32_t));
    }
    if (!f->plain)
        bs_mol__features(mol);
    *out = mol;
    return BS_OK;
}

/* ---- All together ------------------------------------------------------------------------------
 */

static bs_status perceive(finish *f)
{
    bs_arena *scratch = &f->cx->scratch;
    bs_blocks blocks;
    bs_status st;

    if ((st = bs_ring__blocks(f->cx, scratch, f->mol, &blocks)) != BS_OK)
        return st;
    st = bs_kekule__assign(f->cx, f->mol, f->stated, f->wish);
    if (st == BS_EVALUE && f->cx->error.offset >= 0)
        f->cx->error.offset = (long)f->origin[f->cx->error.offset];
    if (st != BS_OK || (st = fill_valences(f)) != BS_OK ||
        (st = bs_ring__find(f->cx, scratch, f->mol, &blocks, &f->rings)) != BS_OK)
        return st;
    count_rings(f);
    if ((st = bs_aromatic__mark(f->cx, f->mol, &f->rings)) != BS_OK ||
        (st = bs_kekule__settle(f->cx, f->mol)) != BS_OK)
        return st;
    if ((st = bs_stereo__place(f->cx, f->draft, f->order, &f->rings, f->mol)) != BS_OK)
        return st;
    if ((st = bs_mol__strip_meaningless_stereo(f->cx, f->mol)) != BS_OK)
        return st;
    bs_stereo__note_unmarked(f->draft, f->order, f->mol);
    return BS_OK;
}

static bs_status finish_draft(bs_draft *draft, bs_arena *home, bool plain, uint32_t **order,
                              bs_mol **out)
{
    bs_ctx *cx = draft->cx;
    finish f = {.cx = cx, .draft = draft, .plain = plain};
    bs_mark kept = bs_arena_mark(home);
    bs_mark temp = bs_arena_mark(&cx->scratch);
    bs_status st = bs_new(cx, order ? home : &cx->scratch, draft->atom_count, &f.order);

    *out = NULL;
    bs_spend(cx, 100 + 20 * (size_t)draft->atom_count);
    if (st == BS_OK && (st = assemble(&f)) == BS_OK && (st = perceive(&f)) == BS_OK)
        st = pack(&f, home, out);
    /* A result in the scratch arena lies above the working memory, which then stays too. */
    if (home != &cx->scratch)
        bs_arena_rewind(&cx->scratch, temp);
    if (st != BS_OK)
        bs_arena_rewind(home, kept);
    if (order)
        *order = st == BS_OK ? f.order : NULL;
    return st;
}

bs_status bs_draft_finish(bs_draft *draft, bs_arena *home, uint32_t **order, bs_mol **out)
{
    return finish_draft(draft, home, false, order, out);
}

bs_status bs_draft__finish_plain(bs_draft *draft, bs_arena *home, uint32_t **order, bs_mol **out)
{
    return finish_draft(draft, home, true, order, out);
}
