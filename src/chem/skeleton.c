/*
 * The skeleton of a molecule: rings, the chains between them, and what hangs on those by double
 * bonds.
 */
#include "backsaw/descriptor.h"
#include "backsaw/draft.h"
#include "chem/mol.h"

typedef struct pruning {
    const bs_mol *mol;
    bool *gone;      /* by atom */
    uint8_t *degree; /* neighbours that are left */
    uint32_t *queue;
} pruning;

/* Takes atoms with one neighbour away until only rings and what joins them is left. */
static void prune(pruning *p)
{
    uint32_t count = 0;

    for (uint32_t i = 0; i < p->mol->atom_count; i++) {
        p->degree[i] = p->mol->atoms[i].degree;
        if (p->degree[i] <= 1)
            p->queue[count++] = i;
    }
    for (uint32_t head = 0; head < count; head++) {
        uint32_t at = p->queue[head];
        const bs_link *links = bs_mol__links(p->mol, at);

        p->gone[at] = true;
        for (int k = 0; k < p->mol->atoms[at].degree; k++) {
            uint32_t next = links[k].atom;

            if (!p->gone[next] && p->degree[next]-- == 2)
                p->queue[count++] = next;
        }
    }
}

/* Brings back atoms that a double bond joins to what is left. */
static void restore(pruning *p)
{
    const bs_bond *bonds = bs_mol__bonds(p->mol);
    uint32_t count = 0;

    for (uint32_t i = 0; i < p->mol->bond_count; i++) {
        if (bonds[i].order >= 2 && p->gone[bonds[i].a] != p->gone[bonds[i].b])
            p->queue[count++] = p->gone[bonds[i].a] ? bonds[i].a : bonds[i].b;
    }
    for (uint32_t i = 0; i < count; i++)
        p->gone[p->queue[i]] = false;
}

/* Takes the atoms out of the draft; what was bonded to them gets hydrogens. */
static void cut(const pruning *p, bs_draft *draft)
{
    const bs_bond *bonds = bs_mol__bonds(p->mol);

    for (uint32_t i = 0; i < p->mol->bond_count; i++) {
        uint32_t a = bonds[i].a;
        uint32_t b = bonds[i].b;
        bs_draft_atom *left = &draft->atoms[p->gone[a] ? b : a];

        if (p->gone[a] == p->gone[b])
            continue;
        left->hydrogens = (int16_t)(left->hydrogens + (int)bonds[i].order);
        draft->bonds[i].gone = true;
    }
    for (uint32_t i = 0; i < p->mol->atom_count; i++)
        draft->atoms[i].gone = p->gone[i];
    for (uint32_t i = 0; i < draft->stereo_count; i++) {
        bs_draft_stereo *s = &draft->stereo[i];
        int size = s->kind == BS_DRAFT_DOUBLE ? 2 : s->kind <= 3 ? 4 : s->kind + 1;

        for (int k = 0; k < size; k++) {
            if (s->around[k] != BS_DRAFT_HYDROGEN && p->gone[s->around[k]])
                s->perm = 0;
        }
        if (p->gone[s->centre] || (s->kind == BS_DRAFT_DOUBLE && p->gone[s->second]))
            s->perm = 0;
        s->written = false;
    }
}

static bs_status build(bs_ctx *cx, bs_arena *home, const pruning *p, bs_mol **out)
{
    bs_draft draft;
    bs_status st;

    bs_draft_init(&draft, cx, &cx->scratch);
    if ((st = bs_draft_from_mol(&draft, p->mol)) != BS_OK)
        return st;
    cut(p, &draft);
    return bs_draft_finish(&draft, home, NULL, out);
}

bs_status bs_mol_skeleton(bs_ctx *cx, bs_arena *home, const bs_mol *mol, bs_mol **out)
{
    bs_mark temp = bs_arena_mark(&cx->scratch);
    pruning p = {.mol = mol};
    bs_status st = BS_OK;

    *out = NULL;
    if (mol->ring_count == 0)
        return BS_OK;
    if ((st = bs_new(cx, &cx->scratch, mol->atom_count, &p.gone)) == BS_OK &&
        (st = bs_new(cx, &cx->scratch, mol->atom_count, &p.degree)) == BS_OK &&
        (st = bs_new(cx, &cx->scratch, mol->atom_count + mol->bond_count, &p.queue)) == BS_OK) {
        prune(&p);
        restore(&p);
        st = build(cx, home, &p, out);
    }
    bs_arena_rewind(&cx->scratch, temp);
    return st;
}
