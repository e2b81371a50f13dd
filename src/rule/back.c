/* Running transforms backwards: from a product to steps that make it. */
#include <stdlib.h>
#include <string.h>

#include "backsaw/format.h"
#include "chem/mol.h"
#include "rule/book.h"

enum { MAX_PLACES = 1000, MAX_STEPS = 1000000 };

/* One precursor, before equal ones are put together. */
typedef struct input {
    bs_mol *mol;
    char *smiles;
    double amount;
    int part; /* of the source */
} input;

/* Where a part of the source came to lie. */
typedef struct berth {
    const bs_mol *mol; /* with its counter-ion */
    int host;          /* the part that it was joined to, or itself */
    uint32_t base;     /* what its atom 0 is in the molecule */
    int item;          /* of the inputs; unset where it was joined */
} berth;

typedef struct inputs {
    input *items;
    int count;
    berth *berths; /* one a part */
} inputs;

/* A transform at work on one piece of the product. */
typedef struct back {
    bs_arena *home;
    const bs_rules *rules;
    const bs_rule_hooks *hooks;
    unsigned flags;
    const bs_watch *watch; /* is told of refused places; or NULL */
    const bs_piece *piece;
    const bs_mol *whole;
    char *smiles; /* of the piece */
    int transform;
    const bs_transform *tr;
    const bs_case *kase;
    int case_number;
    bs_seen seen;
    int *tried; /* for each set seen: case that failed on it, plus 1, or -1 if it has its step */
    int tried_room;
    bs_steps *steps;
    int room;
} back;

/* ---- Precursors ------------------------------------------------------------ */

/* A salt of two molecules. */
static bs_status join_ions(bs_ctx *cx, bs_arena *home, const bs_mol *a, const bs_mol *b,
                           bs_mol **out)
{
    bs_mark temp = bs_arena_mark(&cx->scratch);
    const bs_mol *mols[2] = {a, b};
    bs_draft both;
    bs_status st = BS_OK;

    bs_draft_init(&both, cx, &cx->scratch);
    for (int i = 0; i < 2 && st == BS_OK; i++) {
        uint32_t base = both.atom_count;
        bs_draft one;

        bs_draft_init(&one, cx, &cx->scratch);
        st = bs_draft_from_mol(&one, mols[i]);
        for (uint32_t k = 0; k < one.atom_count && st == BS_OK; k++)
            st = bs_draft_add_atom(&both, one.atoms[k], NULL);
        for (uint32_t k = 0; k < one.bond_count && st == BS_OK; k++)
            st = bs_draft_add_bond(&both, one.bonds[k].a + base, one.bonds[k].b + base,
                                   one.bonds[k].order, NULL);
        for (uint32_t k = 0; k < one.stereo_count && st == BS_OK; k++) {
            bs_draft_stereo element = one.stereo[k];

            element.centre += base;
            element.second += base;
            for (int n = 0; n < 6; n++)
                element.around[n] += element.around[n] == BS_DRAFT_HYDROGEN ? 0 : base;
            st = bs_draft_add_stereo(&both, element);
        }
    }
    if (st == BS_OK)
        st = bs_draft_finish(&both, home, NULL, out);
    bs_arena_rewind(&cx->scratch, temp);
    return st;
}

/* Whether no atom of a part of the precursors comes from the target: a counter-ion, or a reagent. */
static bool is_added(const bs_case *kase, int part)
{
    for (int i = 0; i < kase->source.atom_count; i++) {
        if (kase->source.atoms[i].part == part && kase->back.to_slot[i] < kase->target.atom_count)
            return false;
    }
    return true;
}

/* The part whose charge a counter-ion balances: the nearest, the one before it first; or -1. */
static int partner_of(const inputs *list, int ion)
{
    int charge = bs_mol_charge(list->items[ion].mol);

    for (int distance = 1; distance < list->count; distance++) {
        for (int side = -1; side <= 1; side += 2) {
            int other = ion + side * distance;

            if (other >= 0 && other < list->count && list->items[other].mol &&
                bs_mol_charge(list->items[other].mol) == -charge)
                return other;
        }
    }
    return -1;
}

/* Counter-ions are no compounds of their own: they go with the ion that they balance. */
static bs_status join_salts(bs_ctx *cx, back *b, inputs *list)
{
    bs_status st = BS_OK;

    for (int i = 0; i < list->count && st == BS_OK; i++) {
        int other;

        if (!list->items[i].mol || bs_mol_charge(list->items[i].mol) == 0 || !is_added(b->kase, i))
            continue;
        other = partner_of(list, i);
        if (other < 0)
            continue;
        list->berths[i].host = other;
        list->berths[i].base = list->items[other].mol->atom_count;
        st = join_ions(cx, b->home, list->items[other].mol, list->items[i].mol,
                       &list->items[other].mol);
        if (st == BS_OK)
            st = bs_smiles_canonical(cx, b->home, list->items[other].mol, 0,
                                     &list->items[other].smiles);
        list->items[i].mol = NULL;
    }
    return st;
}

static int compare_inputs(const void *a, const void *b)
{
    const input *x = a, *y = b;

    return strcmp(x->smiles, y->smiles);
}

/* Drops what was joined, orders by SMILES, and adds up equal compounds. */
static void merge_equal(inputs *list)
{
    int count = 0;

    for (int i = 0; i < list->count; i++) {
        list->berths[i].mol = list->items[i].mol;
        if (list->items[i].mol)
            list->items[count++] = list->items[i];
    }
    qsort(list->items, (size_t)count, sizeof *list->items, compare_inputs);
    list->count = 0;
    for (int i = 0; i < count; i++) {
        input *last = list->count > 0 ? &list->items[list->count - 1] : NULL;

        list->berths[list->items[i].part].item = list->count;
        if (last && strcmp(last->smiles, list->items[i].smiles) == 0) {
            list->berths[list->items[i].part].item--;
            last->amount += list->items[i].amount;
        } else {
            list->items[list->count++] = list->items[i];
        }
    }
}

static bs_status find_inputs(bs_ctx *cx, back *b, const bs_result *result, char **smiles,
                             inputs *out)
{
    bs_status st = bs_new(cx, b->home, result->product_count + 1, &out->items);

    if (st == BS_OK)
        st = bs_new(cx, b->home, result->product_count + 1, &out->berths);
    if (st != BS_OK)
        return st;
    out->count = result->product_count;
    for (int i = 0; i < out->count; i++) {
        out->items[i] = (input){result->products[i], smiles[i], b->kase->equivalents[i], i};
        out->berths[i].host = i;
    }
    if ((st = join_salts(cx, b, out)) == BS_OK)
        merge_equal(out);
    return st;
}

/* ---- What reacts ------------------------------------------------------ */

/* Whether an atom of the source takes part. What the rule only looks at counts where it is a
   heteroatom or unsaturated, so that the group which makes the reaction possible is no bystander. */
static bool takes_part(const bs_case *kase, int source, const bs_mol *mol, uint32_t atom)
{
    int slot = kase->back.to_slot[source];

    if (slot >= kase->target.atom_count || kase->back.active[slot] ||
        bs_mol_atom_element(mol, (int)atom) != 6)
        return true;
    for (int k = 0; k < bs_mol_atom_degree(mol, (int)atom); k++) {
        int bond;

        bs_mol_neighbour(mol, (int)atom, k, NULL, &bond);
        if (bs_mol_bond_order(mol, bond) > 1 && !bs_mol_bond_is_aromatic(mol, bond))
            return true;
    }
    return false;
}

/* The atom of `to` that atom `atom` of `from` is, two drawings of one compound. */
static bs_status same_atom(bs_ctx *cx, const bs_mol *from, uint32_t atom, const bs_mol *to,
                           uint32_t *out)
{
    int *a, *b;
    bs_status st;

    *out = atom;
    if (from == to)
        return BS_OK;
    if ((st = bs_mol_canonical_order(cx, &cx->scratch, from, &a)) != BS_OK ||
        (st = bs_mol_canonical_order(cx, &cx->scratch, to, &b)) != BS_OK)
        return st == BS_ELIMIT ? BS_OK : st; /* too symmetrical: any atom will do */
    for (uint32_t i = 0; i < to->atom_count; i++) {
        if (b[i] == a[atom])
            *out = i;
    }
    return BS_OK;
}

/* Marks the atoms of the precursors that take part in the reaction. */
static bs_status mark_reacting(bs_ctx *cx, back *b, const inputs *list, const bs_result *result,
                               bool **reacting)
{
    bs_mark temp = bs_arena_mark(&cx->scratch);
    bs_status st = BS_OK;

    for (int i = 0; i < list->count && st == BS_OK; i++)
        st = bs_new(cx, b->home, list->items[i].mol->atom_count + 1, &reacting[i]);
    for (int k = 0; k < b->kase->source.atom_count && st == BS_OK; k++) {
        const bs_spot *spot = &result->spots[k];
        const berth *own, *host;
        uint32_t atom;

        if (spot->atom == BS_NOWHERE ||
            !takes_part(b->kase, k, result->products[spot->mol], spot->atom))
            continue;
        own = &list->berths[spot->mol];
        host = &list->berths[own->host];
        st = same_atom(cx, host->mol, own->base + spot->atom, list->items[host->item].mol, &atom);
        if (st == BS_OK)
            reacting[host->item][atom] = true;
    }
    bs_arena_rewind(&cx->scratch, temp);
    return st;
}

/* ---- Steps ------------------------------------------------------------ */

static bs_status make_room(bs_ctx *cx, back *b)
{
    int room = b->room ? b->room * 2 : 16;
    bs_step *items;
    bs_status st;

    if (b->steps->count < b->room)
        return BS_OK;
    if ((st = bs_new(cx, b->home, room, &items)) != BS_OK)
        return st;
    if (b->steps->count > 0)
        memcpy(items, b->steps->items, (size_t)b->steps->count * sizeof *items);
    b->steps->items = items;
    b->room = room;
    return BS_OK;
}

/* The site in the whole molecule; `where` is in the piece. */
static bs_status whole_site(bs_ctx *cx, back *b, bs_arena *home, const uint32_t *where,
                            bs_site *out)
{
    uint32_t *atoms;
    bs_status st = bs_new(cx, home, b->kase->target.atom_count + 1, &atoms);

    if (st != BS_OK)
        return st;
    for (int i = 0; i < b->kase->target.atom_count; i++)
        atoms[i] = b->piece->atoms[where[i]];
    return bs_site__fill(cx, home, b->tr, atoms, out);
}

static bs_status add_step(bs_ctx *cx, back *b, const inputs *list, const bs_result *result,
                          const uint32_t *where, const bs_verdict *verdict)
{
    bs_step step = {.transform = b->transform,
                    .precursor_count = list->count,
                    .rivals = verdict->rivals,
                    .stereo_open = verdict->stereo_open,
                    .minor = verdict->minor};
    bs_status st;

    if ((st = make_room(cx, b)) != BS_OK ||
        (st = bs_new(cx, b->home, list->count + 1, &step.precursors)) != BS_OK ||
        (st = bs_new(cx, b->home, list->count + 1, &step.smiles)) != BS_OK ||
        (st = bs_new(cx, b->home, list->count + 1, &step.equivalents)) != BS_OK ||
        (st = bs_new(cx, b->home, list->count + 1, &step.reacting)) != BS_OK ||
        (st = mark_reacting(cx, b, list, result, step.reacting)) != BS_OK ||
        (st = whole_site(cx, b, b->home, where, &step.site)) != BS_OK)
        return st;
    for (int i = 0; i < list->count; i++) {
        step.precursors[i] = list->items[i].mol;
        step.smiles[i] = list->items[i].smiles;
        step.equivalents[i] = list->items[i].amount;
    }
    b->steps->items[b->steps->count++] = step;
    return BS_OK;
}

/* ---- One result of a case ----------------------------------------------------------------- */

/* Tells who watches why a place gives no step. */
static bs_status tell(bs_ctx *cx, back *b, bs_refusal reason, const uint32_t *where,
                      char *const *smiles, int count)
{
    bs_mark temp = bs_arena_mark(&cx->scratch);
    bs_site site;
    bs_status st;

    if (!b->watch)
        return BS_OK;
    if ((st = whole_site(cx, b, &cx->scratch, where, &site)) == BS_OK)
        st = b->watch->refused(b->watch->payload, cx, reason, &site, smiles, count);
    bs_arena_rewind(&cx->scratch, temp);
    return st;
}

static bs_status is_allowed(bs_ctx *cx, back *b, const uint32_t *where, bool *allowed)
{
    bs_mark temp = bs_arena_mark(&cx->scratch);
    int hook = b->tr->def.hook_when;
    bs_site site;
    bs_status st;

    *allowed = true;
    if (hook < 0 || !b->hooks || !b->hooks->when)
        return BS_OK;
    if ((st = whole_site(cx, b, &cx->scratch, where, &site)) == BS_OK)
        st = b->hooks->when(b->hooks->payload, cx, hook, b->whole, &site, allowed);
    bs_arena_rewind(&cx->scratch, temp);
    return st;
}

/* Whether this set of precursors still needs a look, and remembers that it got one. */
static bs_status is_new(bs_ctx *cx, back *b, const inputs *list, int *index, bool *fresh)
{
    bs_mark temp = bs_arena_mark(&cx->scratch);
    char **smiles;
    bs_status st = bs_new(cx, &cx->scratch, list->count + 1, &smiles);

    if (st != BS_OK)
        return st;
    for (int i = 0; i < list->count; i++)
        smiles[i] = list->items[i].smiles;
    st = bs_seen__add(cx, &b->seen, smiles, list->count, index, fresh);
    bs_arena_rewind(&cx->scratch, temp);
    if (st != BS_OK)
        return st;
    if (*index >= b->tried_room) {
        int room = b->tried_room ? b->tried_room * 2 : 32;
        int *wide;

        if ((st = bs_new(cx, &b->seen.arena, room, &wide)) != BS_OK)
            return st;
        if (b->tried_room > 0)
            memcpy(wide, b->tried, (size_t)b->tried_room * sizeof *wide);
        b->tried = wide;
        b->tried_room = room;
    }
    *fresh = b->tried[*index] >= 0 && b->tried[*index] != b->case_number + 1;
    if (*fresh)
        b->tried[*index] = b->case_number + 1;
    return BS_OK;
}

static bool holds_product(const back *b, const inputs *list)
{
    for (int i = 0; i < list->count; i++) {
        if (strcmp(list->items[i].smiles, b->smiles) == 0)
            return true;
    }
    return false;
}

/* Whether a precursor has a bond that its rings cannot hold; what the product has may stay. */
static bs_status is_strained(bs_ctx *cx, const back *b, const bs_result *result, bool *strained)
{
    bs_strain kind = BS_STRAIN_NONE;
    int bond;
    bs_status st = BS_OK;

    for (int i = 0; i < result->product_count && st == BS_OK && kind == BS_STRAIN_NONE; i++)
        st = bs_mol_strain(cx, result->products[i], 0, &kind, &bond);
    *strained = kind != BS_STRAIN_NONE;
    if (st == BS_OK && *strained) {
        st = bs_mol_strain(cx, b->piece->mol, 0, &kind, &bond);
        *strained = kind == BS_STRAIN_NONE;
    }
    return st;
}

static bs_status take_result(void *payload, bs_ctx *cx, const uint32_t *where,
                             const bs_result *result, bool *keep)
{
    back *b = payload;
    bs_verdict verdict = {.passed = true};
    inputs list;
    char **smiles;
    bool fresh, strained;
    int index;
    bs_status st;

    if ((st = is_strained(cx, b, result, &strained)) != BS_OK)
        return st;
    if (strained)
        return tell(cx, b, BS_REFUSED_STRAINED, where, NULL, 0);
    if ((st = is_allowed(cx, b, where, &fresh)) != BS_OK)
        return st;
    if (!fresh)
        return tell(cx, b, BS_REFUSED_WHEN, where, NULL, 0);
    if ((st = bs_result__smiles(cx, b->home, result, &smiles)) != BS_OK ||
        (st = find_inputs(cx, b, result, smiles, &list)) != BS_OK)
        return st;
    if (holds_product(b, &list))
        return tell(cx, b, BS_REFUSED_SAME, where, NULL, 0);
    if ((st = is_new(cx, b, &list, &index, &fresh)) != BS_OK || !fresh)
        return st;
    if (b->hooks && b->hooks->tried)
        b->hooks->tried[b->transform]++;
    if (!(b->flags & BS_BACK_UNCHECKED))
        st = bs_check__step(cx, b->home, b->tr, b->kase, b->hooks, b->flags, result->products,
                            smiles, b->piece->mol, b->smiles, where, &verdict);
    if (st != BS_OK)
        return st;
    if (!verdict.passed || (verdict.minor && !(b->flags & BS_BACK_MINOR)))
        return tell(cx, b, BS_REFUSED_FORWARD, where, smiles, result->product_count);
    b->tried[index] = -1;
    *keep = true;
    return add_step(cx, b, &list, result, where, &verdict);
}

/* ---- All ---------------------------------------------------------------------------------- */

/* Takes a transform whose function failed out of the run, with the steps that it gave. */
static bs_status leave_out(bs_ctx *cx, back *b, int index)
{
    int kept = 0;

    for (int i = 0; i < b->steps->count; i++) {
        if (b->steps->items[i].transform != index)
            b->steps->items[kept++] = b->steps->items[i];
    }
    b->steps->count = kept;
    return bs_rule_faults_add(cx, b->home, b->hooks->faults, index, cx->error.message);
}

static bs_status run_transform(bs_ctx *cx, back *b, int index)
{
    bs_rule_faults *faults = b->hooks ? b->hooks->faults : NULL;
    const bs_transform *tr = b->rules->transforms[index];
    bs_run_opts opts = {.limit = MAX_PLACES,
                        .steps = MAX_STEPS,
                        .every_place = tr->def.hook_when >= 0 && b->hooks && b->hooks->when};
    bs_status st = BS_OK;

    if (faults && bs_rule_faults_find(faults, index))
        return BS_OK;
    b->transform = index;
    b->tr = tr;
    bs_seen__init(&b->seen, cx);
    b->tried = NULL;
    b->tried_room = 0;
    for (int i = 0; i < tr->case_count && st == BS_OK; i++) {
        b->kase = &tr->cases[i];
        b->case_number = i;
        st = bs_run__all(cx, b->home, &b->kase->back, &b->piece->mol, &opts, take_result, b);
        /* A pattern that is too hard for this molecule finds no steps; the others still may. */
        if (st == BS_ELIMIT)
            st = BS_OK;
    }
    bs_seen__free(&b->seen);
    return st == BS_ESCRIPT && faults ? leave_out(cx, b, index) : st;
}

static bs_status run_pieces(bs_ctx *cx, back *b, int first, int last)
{
    bs_piece *pieces;
    int count;
    bs_status st = bs_piece__split(cx, &cx->scratch, b->whole, &pieces, &count);

    for (int k = 0; k < count && st == BS_OK; k++) {
        b->piece = &pieces[k];
        st = bs_smiles_canonical(cx, &cx->scratch, pieces[k].mol, 0, &b->smiles);
        for (int i = first; i < last && st == BS_OK; i++)
            st = run_transform(cx, b, i);
    }
    return st;
}

/* With several pieces, the steps come piece by piece; the book's order counts first. */
static void order_steps(bs_steps *steps)
{
    for (int i = 1; i < steps->count; i++) {
        bs_step step = steps->items[i];
        int at = i;

        for (; at > 0 && steps->items[at - 1].transform > step.transform; at--)
            steps->items[at] = steps->items[at - 1];
        steps->items[at] = step;
    }
}

bs_status bs_back__watched(bs_ctx *cx, bs_arena *home, const bs_rules *rules, int transform,
                           const bs_mol *product, const bs_rule_hooks *hooks, unsigned flags,
                           const bs_watch *watch, bs_steps *out)
{
    bs_mark kept = bs_arena_mark(home);
    bs_mark temp = bs_arena_mark(&cx->scratch);
    back b = {.home = home,
              .rules = rules,
              .hooks = hooks,
              .flags = flags,
              .watch = watch,
              .whole = product,
              .steps = out};
    bs_rule_faults faults = hooks && hooks->faults ? *hooks->faults : (bs_rule_faults){0};
    bs_status st;

    *out = (bs_steps){0};
    if (transform < -1 || transform >= rules->transform_count)
        return bs_fail(cx, BS_ERANGE, "there is no transform number %d", transform);
    st = run_pieces(cx, &b, transform < 0 ? 0 : transform,
                    transform < 0 ? rules->transform_count : transform + 1);
    bs_arena_rewind(&cx->scratch, temp);
    if (st != BS_OK) {
        bs_arena_rewind(home, kept);
        *out = (bs_steps){0};
        if (hooks && hooks->faults)
            *hooks->faults = faults;
        return st;
    }
    order_steps(out);
    return BS_OK;
}

bs_status bs_rules_back(bs_ctx *cx, bs_arena *home, const bs_rules *rules, int transform,
                        const bs_mol *product, const bs_rule_hooks *hooks, unsigned flags,
                        bs_steps *out)
{
    return bs_back__watched(cx, home, rules, transform, product, hooks, flags, NULL, out);
}
