/* Running transforms forwards on given reactants, in whatever order they stand. */
#include <math.h>
#include <string.h>

#include "backsaw/format.h"
#include "chem/mol.h"
#include "rule/book.h"

enum { MAX_ASSIGNMENTS = 400, MAX_FRAGMENTS = 64, MAX_AGAIN = 4 };

/* A piece of a reactant. */
typedef struct fragment {
    bs_piece piece;
    int reactant;
} fragment;

typedef struct forth {
    bs_arena *home;
    const bs_rule_hooks *hooks;
    const bs_mol *const *reactants;
    char **smiles; /* of the reactants */
    int reactant_count;
    fragment *fragments;
    int fragment_count;
    int must; /* the one reactant that has to take part, or -1: all of them */
    bs_product_set *sets;
    int count, room;
} forth;

/* One case, while its parts are dealt out to the fragments. */
typedef struct deal {
    forth *f;
    bs_forward *run;
    const bs_case *kase;
    bool *fits; /* part * (fragment_count + 1) + fragment; the last one is the part's reagent */
    int *dealt; /* for each part the fragment; fragment_count for its reagent */
    int tried;
} deal;

/* ---- Dealing out ------------------------------------------------------------------------------
 */

static bs_status find_fits(bs_ctx *cx, deal *d)
{
    int parts = d->kase->source.part_count, fragments = d->f->fragment_count;
    int width = fragments + 1;
    bs_status st = bs_new(cx, &cx->scratch, parts * width + 1, &d->fits);

    for (int p = 0; p < parts && st == BS_OK; p++) {
        for (int k = 0; k < fragments && st == BS_OK; k++)
            st = bs_pattern_has(cx, d->kase->source.patterns[p], d->f->fragments[k].piece.mol,
                                &d->fits[p * width + k]);
        d->fits[p * width + fragments] = d->kase->reagents[p] != NULL;
    }
    if (st != BS_OK)
        return st;
    return bs_new(cx, &cx->scratch, parts + 1, &d->dealt);
}

/*
 * Whether a full deal makes sense: every reactant takes part, and a fragment serves two parts only
 * where there are fewer reactants than parts (a compound that reacts with itself).
 */
static bool is_sensible(const deal *d)
{
    int parts = d->kase->source.part_count, wanting = 0;
    bool scarce;

    for (int r = 0; r < d->f->reactant_count; r++) {
        bool used = d->f->must >= 0 && d->f->must != r;

        for (int p = 0; p < parts; p++)
            used = used || (d->dealt[p] < d->f->fragment_count &&
                            d->f->fragments[d->dealt[p]].reactant == r);
        if (!used)
            return false;
    }
    for (int p = 0; p < parts; p++)
        wanting += d->dealt[p] < d->f->fragment_count;
    scarce = d->f->reactant_count < wanting;
    for (int p = 0; p < parts && !scarce; p++) {
        for (int q = 0; q < p; q++) {
            if (d->dealt[p] == d->dealt[q] && d->dealt[p] < d->f->fragment_count)
                return false;
        }
    }
    return true;
}

static bs_status run_deal(bs_ctx *cx, deal *d)
{
    bs_mark temp = bs_arena_mark(&cx->scratch);
    int parts = d->kase->source.part_count;
    const bs_mol **mols;
    uint32_t *reactant;
    bs_status st;

    if ((st = bs_new(cx, &cx->scratch, parts + 1, &mols)) != BS_OK ||
        (st = bs_new(cx, &cx->scratch, parts + 1, &reactant)) != BS_OK)
        return st;
    for (int p = 0; p < parts; p++) {
        mols[p] = d->dealt[p] < d->f->fragment_count ? d->f->fragments[d->dealt[p]].piece.mol
                                                     : d->kase->reagents[p];
        reactant[p] = (uint32_t)d->dealt[p];
    }
    st = bs_forward__run(cx, d->run, d->kase, mols, reactant);
    bs_arena_rewind(&cx->scratch, temp);
    return st;
}

/* The next deal in which every part fits its fragment, from part `p` on; false after the last. */
static bool advance(deal *d, bool first)
{
    int parts = d->kase->source.part_count, fragments = d->f->fragment_count + 1;
    int p = first ? 0 : parts - 1;

    if (first)
        d->dealt[0] = -1;
    while (p >= 0) {
        int k = d->dealt[p] + 1;

        while (k < fragments && !d->fits[p * fragments + k])
            k++;
        d->dealt[p] = k;
        if (k == fragments)
            p--;
        else if (p == parts - 1)
            return true;
        else
            d->dealt[++p] = -1;
    }
    return false;
}

static bs_status run_case(bs_ctx *cx, forth *f, bs_forward *run, const bs_case *kase)
{
    bs_mark temp = bs_arena_mark(&cx->scratch);
    deal d = {.f = f, .run = run, .kase = kase};
    bs_status st = BS_OK;

    if (f->must >= 0 || f->reactant_count <= kase->source.part_count) {
        st = find_fits(cx, &d);
        for (bool more = st == BS_OK && advance(&d, true);
             more && st == BS_OK && d.tried < MAX_ASSIGNMENTS; more = advance(&d, false)) {
            if (!is_sensible(&d))
                continue;
            d.tried++;
            st = run_deal(cx, &d);
        }
    }
    bs_arena_rewind(&cx->scratch, temp);
    return st;
}

/* ---- Collecting ---------------------------------------------------------------------------------
 */

static bs_status make_room(bs_ctx *cx, forth *f, int more)
{
    int room = f->room ? f->room * 2 : 16;
    bs_product_set *sets;
    bs_status st;

    if (f->count + more <= f->room)
        return BS_OK;
    while (room < f->count + more)
        room *= 2;
    if ((st = bs_new(cx, f->home, room, &sets)) != BS_OK)
        return st;
    if (f->count > 0)
        memcpy(sets, f->sets, (size_t)f->count * sizeof *sets);
    f->sets = sets;
    f->room = room;
    return BS_OK;
}

/* A "product" that is one of the reactants is no reaction. */
static bool is_reactant(const forth *f, const bs_outcome *outcome)
{
    for (int i = 0; i < f->reactant_count; i++) {
        if (strcmp(f->smiles[i], outcome->smiles[0]) == 0)
            return true;
    }
    return false;
}

/* Moves the sites of an outcome from the fragments to the reactants. */
static void move_site(const forth *f, bs_outcome *outcome)
{
    for (int k = 0; k < outcome->site_count; k++) {
        const fragment *piece = &f->fragments[outcome->site_reactant[k]];

        if (outcome->site_reactant[k] >= (uint32_t)f->fragment_count) {
            outcome->site_reactant[k] = UINT32_MAX;
            continue;
        }
        outcome->site_reactant[k] = (uint32_t)piece->reactant;
        outcome->site_atom[k] = piece->piece.atoms[outcome->site_atom[k]];
    }
}

/* Tells of the sets from `first` on which are major, and with `scored` which are expected still. */
static void find_major(forth *f, int first, bool scored)
{
    double best = -HUGE_VAL;

    for (int i = first; i < f->count; i++) {
        if (f->sets[i].score > best)
            best = f->sets[i].score;
    }
    for (int i = first; i < f->count; i++) {
        bs_product_set *set = &f->sets[i];

        set->major =
            scored ? best > -HUGE_VAL && set->score > best - BS_SCORE_NOISE : set->expected;
        set->expected = set->expected && set->major;
    }
}

/* Expected sets first, then by score; what is equal stays in the order in which it was found. */
static bool comes_before(const bs_product_set *a, const bs_product_set *b)
{
    if (a->expected != b->expected)
        return a->expected;
    return a->score > b->score;
}

static void order_sets(bs_product_set *sets, int count)
{
    for (int i = 1; i < count; i++) {
        bs_product_set set = sets[i];
        int at = i;

        for (; at > 0 && comes_before(&set, &sets[at - 1]); at--)
            sets[at] = sets[at - 1];
        sets[at] = set;
    }
}

/* Tells the kinds of the sets from `first` on, by the first of them; sites are in fragments. */
static bs_status find_kinds(bs_ctx *cx, const forth *f, int first)
{
    bs_mark temp = bs_arena_mark(&cx->scratch);
    const bs_mol **mols;
    bs_status st = bs_new(cx, &cx->scratch, f->fragment_count + 1, &mols);

    for (int i = 0; i < f->fragment_count && st == BS_OK; i++)
        mols[i] = f->fragments[i].piece.mol;
    for (int i = first + 1; i < f->count && st == BS_OK; i++) {
        if (!f->sets[i].expected)
            st = bs_rival__kind(cx, &f->sets[first].outcome, &f->sets[i].outcome, mols,
                                f->fragment_count, &f->sets[i].outcome.kind);
    }
    bs_arena_rewind(&cx->scratch, temp);
    return st;
}

static bs_status take_made(bs_ctx *cx, forth *f, const bs_forward *run, int transform)
{
    int first = f->count;
    bs_status st = make_room(cx, f, run->made.count);

    if (st != BS_OK)
        return st;
    for (int i = 0; i < run->made.count; i++) {
        const bs_made *made = &run->made.items[i];

        if (!is_reactant(f, &made->outcome))
            f->sets[f->count++] = (bs_product_set){.transform = transform,
                                                   .expected = made->expected,
                                                   .score = made->score,
                                                   .outcome = made->outcome};
    }
    find_major(f, first, run->score);
    order_sets(f->sets + first, f->count - first);
    st = find_kinds(cx, f, first);
    for (int i = first; i < f->count; i++)
        move_site(f, &f->sets[i].outcome);
    return st;
}

/* ---- Running one transform
 * ----------------------------------------------------------------------- */

static bs_status run_transform(bs_ctx *cx, forth *f, const bs_rules *rules, int index)
{
    const bs_transform *tr = rules->transforms[index];
    bs_forward run;
    bs_status st = BS_OK;

    bs_forward__init(&run, cx, f->home, tr, f->hooks, true);
    for (int i = 0; i < tr->case_count && st == BS_OK; i++) {
        st = run_case(cx, f, &run, &tr->cases[i]);
        if (st == BS_ELIMIT)
            st = BS_OK;
    }
    if (st == BS_OK)
        st = take_made(cx, f, &run, index);
    bs_forward__free(&run);
    return st;
}

static bs_status take_apart(bs_ctx *cx, forth *f)
{
    bs_status st;

    if ((st = bs_new(cx, &cx->scratch, MAX_FRAGMENTS, &f->fragments)) != BS_OK ||
        (st = bs_new(cx, &cx->scratch, f->reactant_count + 1, &f->smiles)) != BS_OK)
        return st;
    for (int i = 0; i < f->reactant_count; i++) {
        bs_piece *pieces;
        int count;

        if ((st = bs_piece__split(cx, &cx->scratch, f->reactants[i], &pieces, &count)) != BS_OK ||
            (st = bs_smiles_canonical(cx, &cx->scratch, f->reactants[i], 0, &f->smiles[i])) !=
                BS_OK)
            return st;
        if (f->fragment_count + count > MAX_FRAGMENTS)
            return bs_fail(cx, BS_ELIMIT, "the reactants have more than %d pieces", MAX_FRAGMENTS);
        for (int k = 0; k < count; k++)
            f->fragments[f->fragment_count++] = (fragment){pieces[k], i};
    }
    return BS_OK;
}

static bool any_expected(const forth *f, int first)
{
    for (int i = first; i < f->count; i++)
        if (f->sets[i].expected)
            return true;
    return false;
}

/* ---- The product reacts again -------------------------------------------------------------------
 */

/* Whether one of the sets from `first` on has the same first product. */
static bool is_listed(const forth *f, int first, const bs_outcome *outcome)
{
    for (int i = first; i < f->count; i++) {
        if (strcmp(f->sets[i].outcome.smiles[0], outcome->smiles[0]) == 0)
            return true;
    }
    return false;
}

/* Adds what the product gives with the reactants of `f`, as kind BS_RIVAL_OVER. */
static bs_status react_again(bs_ctx *cx, forth *f, const bs_rules *rules, int transform, int first,
                             const bs_mol *product)
{
    bs_mark temp = bs_arena_mark(&cx->scratch);
    forth again = {.home = f->home, .hooks = f->hooks, .reactant_count = f->reactant_count + 1};
    const bs_mol **mols;
    bs_status st = bs_new(cx, &cx->scratch, again.reactant_count, &mols);

    if (st == BS_OK) {
        mols[0] = product;
        for (int i = 0; i < f->reactant_count; i++)
            mols[i + 1] = f->reactants[i];
        again.reactants = mols;
        st = take_apart(cx, &again);
    }
    if (st == BS_OK)
        st = run_transform(cx, &again, rules, transform);
    if (st == BS_OK)
        st = make_room(cx, f, again.count);
    for (int i = 0; i < again.count && st == BS_OK; i++) {
        if (!again.sets[i].expected || is_listed(f, first, &again.sets[i].outcome))
            continue;
        f->sets[f->count] = again.sets[i];
        f->sets[f->count].expected = f->sets[f->count].major = false;
        f->sets[f->count++].outcome.kind = BS_RIVAL_OVER;
    }
    bs_arena_rewind(&cx->scratch, temp);
    return st;
}

static bs_status add_over_reactions(bs_ctx *cx, forth *f, const bs_rules *rules, int transform,
                                    int first)
{
    int wanted = 0;
    bs_status st = BS_OK;

    while (first + wanted < f->count && f->sets[first + wanted].expected && wanted < MAX_AGAIN)
        wanted++;
    for (int i = 0; i < wanted && st == BS_OK; i++)
        st = react_again(cx, f, rules, transform, first, f->sets[first + i].outcome.products[0]);
    return st;
}

bs_status bs_rules_again(bs_ctx *cx, bs_arena *home, const bs_rules *rules, int transform,
                         const bs_mol *product, const bs_mol *const *precursors, int count,
                         const bs_rule_hooks *hooks, bs_outcomes *out)
{
    bs_mark temp = bs_arena_mark(&cx->scratch);
    forth f = {
        .home = home, .hooks = hooks, .reactants = precursors, .reactant_count = count, .must = -1};
    bs_status st;

    *out = (bs_outcomes){0};
    if (transform < 0 || transform >= rules->transform_count)
        return bs_fail(cx, BS_ERANGE, "there is no transform number %d", transform);
    st = react_again(cx, &f, rules, transform, 0, product);
    if (st == BS_OK)
        st = bs_new(cx, home, f.count + 1, &out->items);
    for (int i = 0; i < f.count && st == BS_OK; i++)
        out->items[out->count++] = f.sets[i].outcome;
    bs_arena_rewind(&cx->scratch, temp);
    return st;
}

/* ---- All
 * ----------------------------------------------------------------------------------------- */

/* Expected sets first, over-reactions last; else as they are. */
static bs_status gather(bs_ctx *cx, bs_arena *home, const forth *f, bs_product_sets *out)
{
    bs_status st = bs_new(cx, home, f->count + 1, &out->items);

    for (int pass = 0; pass < 3 && st == BS_OK; pass++) {
        for (int i = 0; i < f->count; i++) {
            const bs_product_set *set = &f->sets[i];
            int place = set->expected ? 0 : set->outcome.kind == BS_RIVAL_OVER ? 2 : 1;

            if (place == pass)
                out->items[out->count++] = *set;
        }
    }
    return st;
}

bs_status bs_rules_forth(bs_ctx *cx, bs_arena *home, const bs_rules *rules, int transform,
                         const bs_mol *const *reactants, int count, const bs_rule_hooks *hooks,
                         bs_product_sets *out)
{
    bs_mark kept = bs_arena_mark(home);
    bs_mark temp = bs_arena_mark(&cx->scratch);
    int last = transform < 0 ? rules->transform_count : transform + 1;
    forth f = {
        .home = home, .hooks = hooks, .reactants = reactants, .reactant_count = count, .must = -1};
    bs_status st;

    *out = (bs_product_sets){0};
    if (transform < -1 || transform >= rules->transform_count)
        return bs_fail(cx, BS_ERANGE, "there is no transform number %d", transform);
    if (count < 1)
        return bs_fail(cx, BS_EVALUE, "a reaction needs at least one reactant");
    st = take_apart(cx, &f);
    for (int i = transform < 0 ? 0 : transform; i < last && st == BS_OK; i++) {
        int before = f.count;

        st = run_transform(cx, &f, rules, i);
        /* Asked of all: a transform that cannot give what it is for has nothing to say. */
        if (transform < 0 && st == BS_OK && !any_expected(&f, before))
            f.count = before;
        else if (st == BS_OK)
            st = add_over_reactions(cx, &f, rules, i, before);
    }
    if (st == BS_OK)
        st = gather(cx, home, &f, out);
    bs_arena_rewind(&cx->scratch, temp);
    if (st != BS_OK) {
        bs_arena_rewind(home, kept);
        *out = (bs_product_sets){0};
    }
    return st;
}
