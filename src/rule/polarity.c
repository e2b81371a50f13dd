/* Donors and acceptors: labels by position, consonance, and which end is turned if need be. */
#include "backsaw/polarity.h"

#include <stdio.h>
#include <stdlib.h>
#include <string.h>

#include "chem/mol.h"

enum { MAX_CHAINS = 1000, MAX_WALK = 200000 };

static bool is_heteroatom(int element)
{
    return element == 7 || element == 8 || element == 15 || element == 16 || element == 34;
}

static int order_between(const bs_mol *mol, int a, int b)
{
    return bs_mol_bond_order(mol, bs_mol_bond_between(mol, a, b));
}

/* The heteroatom that a carbon atom bears, by a multiple bond rather than a single one; or -1. */
static int borne_by(const bs_mol *mol, int atom, int partner)
{
    const bs_link *links = bs_mol__links(mol, (uint32_t)atom);
    int found = -1, best = 0;

    for (int k = 0; k < mol->atoms[atom].degree; k++) {
        int other = (int)links[k].atom;
        int order = bs_mol_bond_order(mol, (int)links[k].bond);

        if (other != partner && is_heteroatom(mol->atoms[other].element) && order > best) {
            found = other;
            best = order;
        }
    }
    return found;
}

/* ---- Positions --------------------------------------------------------------------------------
 */

/* Carbon atoms reached from one end of a bond, in order of distance. */
typedef struct walk {
    int *atoms, *distance;
    int count;
} walk;

static bool was_reached(const walk *w, int atom)
{
    for (int i = 0; i < w->count; i++) {
        if (w->atoms[i] == atom)
            return true;
    }
    return false;
}

static void find_position(const bs_mol *mol, int partner, walk *w, bs_pole *pole)
{
    for (int i = 0; i < w->count; i++) {
        const bs_link *links = bs_mol__links(mol, (uint32_t)w->atoms[i]);

        pole->heteroatom = borne_by(mol, w->atoms[i], partner);
        if (pole->heteroatom >= 0) {
            pole->position = w->distance[i] + 1;
            return;
        }
        if (w->distance[i] + 1 >= BS_POLE_FAR)
            return;
        for (int k = 0; k < mol->atoms[w->atoms[i]].degree; k++) {
            int next = (int)links[k].atom;

            if (next == partner || mol->atoms[next].element != 6 || was_reached(w, next))
                continue;
            w->atoms[w->count] = next;
            w->distance[w->count++] = w->distance[i] + 1;
        }
    }
}

/* Where an end of a bond stands; its role is open. */
static bs_status place_end(bs_ctx *cx, const bs_mol *mol, int atom, int partner, bs_pole *out)
{
    bs_mark temp = bs_arena_mark(&cx->scratch);
    walk w = {0};
    bs_status st;

    *out = (bs_pole){.atom = atom, .position = -1, .heteroatom = -1};
    if (mol->atoms[atom].element != 6) {
        out->position = is_heteroatom(mol->atoms[atom].element) ? 0 : -1;
        out->heteroatom = out->position == 0 ? atom : -1;
        return BS_OK;
    }
    if ((st = bs_new(cx, &cx->scratch, mol->atom_count, &w.atoms)) != BS_OK ||
        (st = bs_new(cx, &cx->scratch, mol->atom_count, &w.distance)) != BS_OK)
        goto done;
    w.atoms[w.count++] = atom;
    find_position(mol, partner, &w, out);
done:
    bs_arena_rewind(&cx->scratch, temp);
    return st;
}

static void give_role(bs_pole *pole, bool acceptor)
{
    pole->acceptor = acceptor;
    pole->umpolung = pole->position >= 0 && acceptor != (pole->position % 2 == 1);
}

static bs_status check_bond(bs_ctx *cx, const bs_mol *mol, int a, int b)
{
    int count = bs_mol_atom_count(mol);

    if (a < 0 || b < 0 || a >= count || b >= count)
        return bs_fail(cx, BS_ERANGE, "atom %d is not there; the molecule has %d",
                       (a < 0 || a >= count ? a : b) + 1, count);
    if (a == b || bs_mol_bond_between(mol, a, b) < 0)
        return bs_fail(cx, BS_EVALUE, "atoms %d and %d are not bonded", a + 1, b + 1);
    return BS_OK;
}

/* ---- Which end is turned -------------------------------------------------------------------- */

static bool has_triple_bond(const bs_mol *mol, int atom)
{
    const bs_link *links = bs_mol__links(mol, (uint32_t)atom);

    for (int k = 0; k < mol->atoms[atom].degree; k++) {
        if (bs_mol_bond_order(mol, (int)links[k].bond) == 3)
            return true;
    }
    return false;
}

static bool bears_arene(const bs_mol *mol, int atom)
{
    const bs_link *links = bs_mol__links(mol, (uint32_t)atom);

    for (int k = 0; k < mol->atoms[atom].degree; k++) {
        if (mol->atoms[links[k].atom].flags & BS_ATOM_AROMATIC)
            return true;
    }
    return false;
}

/* How readily an acceptor by nature is bought or made as a donor. */
static int ease_as_donor(const bs_mol *mol, const bs_pole *pole)
{
    int order;

    if (pole->position == 1) {
        order = order_between(mol, pole->atom, pole->heteroatom);
        if (order == 3)
            return 5; /* cyanide */
        if (mol->atoms[pole->heteroatom].element == 7 && mol->atoms[pole->heteroatom].charge > 0)
            return 6; /* nitroalkane */
        if (order == 2)
            return bears_arene(mol, pole->atom) ? 4 : 3; /* dithiane, thiazolium */
        return 0;
    }
    return has_triple_bond(mol, pole->atom) ? 4 : 1; /* acetylide; homoenolate */
}

/* How readily a donor by nature is bought or made as an acceptor. */
static int ease_as_acceptor(const bs_mol *mol, const bs_pole *pole)
{
    const bs_link *links;
    int bearer = -1, others = 0;

    if (pole->position == 0)
        return -1;
    if (pole->position != 2)
        return 0;
    links = bs_mol__links(mol, (uint32_t)pole->heteroatom);
    for (int k = 0; k < mol->atoms[pole->heteroatom].degree && bearer < 0; k++) {
        if (bs_mol_bond_between(mol, (int)links[k].atom, pole->atom) >= 0)
            bearer = (int)links[k].atom;
    }
    if (bearer < 0)
        return 0;
    if (order_between(mol, bearer, pole->heteroatom) == 1)
        return 3; /* epoxide */
    links = bs_mol__links(mol, (uint32_t)bearer);
    for (int k = 0; k < mol->atoms[bearer].degree; k++)
        others += mol->atoms[links[k].atom].element != 6;
    return others > 1 ? 2 : 1; /* halo ester; halo ketone */
}

/* Both ends are alike by nature: one has to be turned. */
static void settle_dissonant(const bs_mol *mol, bs_polarity *out)
{
    bool acceptors = out->ends[0].position % 2 == 1;
    int first =
        acceptors ? ease_as_donor(mol, &out->ends[0]) : ease_as_acceptor(mol, &out->ends[0]);
    int second =
        acceptors ? ease_as_donor(mol, &out->ends[1]) : ease_as_acceptor(mol, &out->ends[1]);
    int turned = first > second ? 0 : 1;

    give_role(&out->ends[turned], !acceptors);
    give_role(&out->ends[1 - turned], acceptors);
}

bs_status bs_polarity_of_bond(bs_ctx *cx, const bs_mol *mol, int a, int b, bs_polarity *out)
{
    bs_status st;
    int known;

    *out = (bs_polarity){0};
    if ((st = check_bond(cx, mol, a, b)) != BS_OK ||
        (st = place_end(cx, mol, a, b, &out->ends[0])) != BS_OK ||
        (st = place_end(cx, mol, b, a, &out->ends[1])) != BS_OK)
        return st;
    if (out->ends[0].position >= 0 && out->ends[1].position >= 0) {
        out->relation = out->ends[0].position + out->ends[1].position;
        out->dissonant = out->relation % 2 == 0;
    }
    if (out->dissonant) {
        settle_dissonant(mol, out);
        return BS_OK;
    }
    /* The end whose nature is known decides; of two alkyl ends the first is called the donor. */
    known = out->ends[0].position >= 0 ? 0 : 1;
    give_role(&out->ends[known],
              out->ends[known].position < 0 || out->ends[known].position % 2 == 1);
    give_role(&out->ends[1 - known], !out->ends[known].acceptor);
    return BS_OK;
}

bs_status bs_polarity_of_end(bs_ctx *cx, const bs_mol *mol, int atom, int partner, bool acceptor,
                             bs_pole *out)
{
    bs_status st = check_bond(cx, mol, atom, partner);

    if (st == BS_OK)
        st = place_end(cx, mol, atom, partner, out);
    if (st == BS_OK)
        give_role(out, acceptor);
    return st;
}

/* ---- Pairs ------------------------------------------------------------------------------------
 */

/* The chains between two heteroatoms, followed depth first without recursion. */
typedef struct chains {
    const bs_mol *mol;
    int goal;
    int *path, *next; /* atoms so far, and the neighbour to try next of each */
    bool *on_path;
    int depth;
    long steps;
    int *lengths;
    int count;
    int *best;
    int best_length;
} chains;

static void take_chain(chains *c)
{
    int length = c->depth - 1; /* without the first heteroatom */

    if (c->count < MAX_CHAINS)
        c->lengths[c->count++] = length;
    if (c->best_length == 0 || length < c->best_length) {
        c->best_length = length;
        memcpy(c->best, c->path, (size_t)c->depth * sizeof *c->best);
        c->best[c->depth] = c->goal;
    }
}

static void follow_chains(chains *c, int start)
{
    c->path[0] = start;
    c->next[0] = 0;
    c->depth = 1;
    while (c->depth > 0 && ++c->steps < MAX_WALK) {
        int atom = c->path[c->depth - 1];
        int k = c->next[c->depth - 1]++;
        int other;

        if (k >= c->mol->atoms[atom].degree) {
            c->on_path[atom] = false;
            c->depth--;
            continue;
        }
        other = (int)bs_mol__links(c->mol, (uint32_t)atom)[k].atom;
        if (other == c->goal && c->depth > 1)
            take_chain(c);
        if (c->mol->atoms[other].element != 6 || c->on_path[other])
            continue;
        c->on_path[other] = true;
        c->path[c->depth] = other;
        c->next[c->depth++] = 0;
    }
}

static int compare_ints(const void *a, const void *b)
{
    int x = *(const int *)a, y = *(const int *)b;

    return (x > y) - (x < y);
}

static bs_status check_pair(bs_ctx *cx, const bs_mol *mol, int a, int b)
{
    int count = bs_mol_atom_count(mol);
    const int atoms[2] = {a, b};

    for (int i = 0; i < 2; i++) {
        if (atoms[i] < 0 || atoms[i] >= count)
            return bs_fail(cx, BS_ERANGE, "atom %d is not there; the molecule has %d", atoms[i] + 1,
                           count);
        if (mol->atoms[atoms[i]].element == 6 || mol->atoms[atoms[i]].element == 1)
            return bs_fail(cx, BS_EVALUE, "atom %d is no heteroatom", atoms[i] + 1);
    }
    return a == b ? bs_fail(cx, BS_EVALUE, "two different heteroatoms are expected") : BS_OK;
}

bs_status bs_polarity_of_pair(bs_ctx *cx, bs_arena *home, const bs_mol *mol, int a, int b,
                              bs_relation *out)
{
    bs_mark kept = bs_arena_mark(home), temp = bs_arena_mark(&cx->scratch);
    chains c = {.mol = mol, .goal = b};
    size_t room = (size_t)mol->atom_count + 2;
    bs_status st;

    *out = (bs_relation){0};
    if ((st = check_pair(cx, mol, a, b)) != BS_OK)
        return st;
    if ((st = bs_new(cx, home, MAX_CHAINS, &c.lengths)) != BS_OK ||
        (st = bs_new(cx, home, room, &c.best)) != BS_OK ||
        (st = bs_new(cx, &cx->scratch, room, &c.path)) != BS_OK ||
        (st = bs_new(cx, &cx->scratch, room, &c.next)) != BS_OK ||
        (st = bs_new(cx, &cx->scratch, room, &c.on_path)) != BS_OK)
        goto done;
    memset(c.on_path, 0, room * sizeof *c.on_path);
    follow_chains(&c, a);
    bs_spend(cx, (size_t)c.steps);
    qsort(c.lengths, (size_t)c.count, sizeof *c.lengths, compare_ints);
    *out = (bs_relation){.lengths = c.lengths,
                         .chain = c.best,
                         .count = c.count,
                         .dissonant = c.best_length % 2 == 0};
done:
    bs_arena_rewind(&cx->scratch, temp);
    if (st != BS_OK)
        bs_arena_rewind(home, kept);
    return st;
}

char *bs_pole_label(const bs_pole *pole, char *buffer, size_t room)
{
    char role = pole->acceptor ? 'a' : 'd';

    if (pole->position < 0)
        snprintf(buffer, room, "alkyl-%c", role);
    else
        snprintf(buffer, room, "%c%d", role, pole->position);
    return buffer;
}
