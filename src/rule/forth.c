/* Running transforms forwards on given reactants, in whatever order they stand. */
#include <string.h>

#include "backsaw/format.h"
#include "chem/mol.h"
#include "rule/book.h"

enum { MAX_ASSIGNMENTS = 400, MAX_FRAGMENTS = 64 };

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
    bs_product_set *sets;
    int count, room;
} forth;

/* One case, while its parts are dealt out to the fragments. */
typedef struct deal {
    forth *f;
    bs_forward *run;
    const bs_case *kase;
    bool *fits;  /* part * fragment_count + fragment */
    int *dealt;  /* for each part the fragment */
    int tried;
} deal;

/* ---- Dealing out ------------------------------------------------------------------------------ */

static bs_status find_fits(bs_ctx *cx, deal *d)
{
    int parts = d->kase->source.part_count, fragments = d->f->fragment_count;
    bs_status st = bs_new(cx, &cx->scratch, parts * fragments + 1, &d->fits);

    for (int p = 0; p < parts && st == BS_OK; p++) {
        for (int k = 0; k < fragments && st == BS_OK; k++)
            st = bs_pattern_has(cx, d->kase->source.patterns[p], d->f->fragments[k].piece.mol,
                                &d->fits[p * fragments + k]);
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
    int parts = d->kase->source.part_count;
    bool scarce = d->f->reactant_count < parts;

    for (int r = 0; r < d->f->reactant_count; r++) {
        bool used = false;

        for (int p = 0; p < parts; p++)
            used = used || d->f->fragments[d->dealt[p]].reactant == r;
        if (!used)
            return false;
    }
    for (int p = 0; p < parts && !scarce; p++) {
        for (int q = 0; q < p; q++) {
            if (d->dealt[p] == d->dealt[q])
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
        mols[p] = d->f->fragments[d->dealt[p]].piece.mol;
        reactant[p] = (uint32_t)d->dealt[p];
    }
    st = bs_forward__run(cx, d->run, d->kase, mols, reactant);
    bs_arena_rewind(&cx->scratch, temp);
    return st;
}

/* The next deal in which every part fits its fragment, from part `p` on; false after the last. */
static bool advance(deal *d, bool first)
{
    int parts = d->kase->source.part_count, fragments = d->f->fragment_count;
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

    if (f->reactant_count <= kase->source.part_count) {
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

/* ---- Collecting --------------------------------------------------------------------------------- */

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

static bs_status take_made(bs_ctx *cx, forth *f, const bs_forward *run, int transform)
{
    bs_status st = make_room(cx, f, run->made.count);

    for (int i = 0; i < run->made.count && st == BS_OK; i++) {
        bs_made *made = &run->made.items[i];
        bs_outcome *outcome = &made->outcome;

        if (is_reactant(f, outcome))
            continue;
        for (int k = 0; k < outcome->site_count; k++) {
            const fragment *piece = &f->fragments[outcome->site_reactant[k]];

            outcome->site_reactant[k] = (uint32_t)piece->reactant;
            outcome->site_atom[k] = piece->piece.atoms[outcome->site_atom[k]];
        }
        f->sets[f->count++] =
            (bs_product_set){transform, made->expected, made->score, *outcome};
    }
    return st;
}

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

/* ---- All ------------------------------------------------------------------------------------------- */

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
            (st = bs_smiles_canonical(cx, &cx->scratch, f->reactants[i], 0, &f->smiles[i])) != BS_OK)
            return st;
        if (f->fragment_count + count > MAX_FRAGMENTS)
            return bs_fail(cx, BS_ELIMIT, "the reactants have more than %d pieces", MAX_FRAGMENTS);
        for (int k = 0; k < count; k++)
            f->fragments[f->fragment_count++] = (fragment){pieces[k], i};
    }
    return BS_OK;
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

static bool any_expected(const forth *f, int first)
{
    for (int i = first; i < f->count; i++)
        if (f->sets[i].expected)
            return true;
    return false;
}

bs_status bs_rules_forth(bs_ctx *cx, bs_arena *home, const bs_rules *rules, int transform,
                         const bs_mol *const *reactants, int count, const bs_rule_hooks *hooks,
                         bs_product_sets *out)
{
    bs_mark kept = bs_arena_mark(home);
    bs_mark temp = bs_arena_mark(&cx->scratch);
    int last = transform < 0 ? rules->transform_count : transform + 1;
    forth f = {.home = home, .hooks = hooks, .reactants = reactants, .reactant_count = count};
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
    }
    bs_arena_rewind(&cx->scratch, temp);
    if (st != BS_OK) {
        bs_arena_rewind(home, kept);
        return st;
    }
    order_sets(f.sets, f.count);
    *out = (bs_product_sets){f.sets, f.count};
    return BS_OK;
}
