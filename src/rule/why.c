/* Explanations: watches a transform at work, and tells what stood in the way. */
#include "backsaw/why.h"

#include <string.h>

#include "backsaw/draft.h"
#include "backsaw/format.h"
#include "match/near.h"
#include "rule/book.h"

enum { MAX_REASONS = 20, MAX_INSTEAD = 5, NEAR_MISS = 2 };

typedef struct why {
    bs_ctx *cx;
    bs_arena *home;
    const bs_rules *rules;
    int transform;
    const bs_mol *product;
    const bs_rule_hooks *hooks;
    bs_reasons *out;
} why;

/* ---- Reasons ---------------------------------------- */

/* The SMILES of a molecule with some atoms in class 1 and no other classes. */
static bs_status mark_atoms(bs_ctx *cx, bs_arena *home, const bs_mol *mol, const uint32_t *atoms,
                            int count, char **out)
{
    bs_mark temp = bs_arena_mark(&cx->scratch);
    bs_draft draft;
    bs_mol *marked;
    bs_status st;

    bs_draft_init(&draft, cx, &cx->scratch);
    if ((st = bs_draft_from_mol(&draft, mol)) == BS_OK) {
        for (uint32_t i = 0; i < draft.atom_count; i++)
            draft.atoms[i].label = 0;
        for (int i = 0; i < count; i++)
            draft.atoms[atoms[i]].label = 1;
        st = bs_draft_finish(&draft, home, NULL, &marked);
    }
    if (st == BS_OK)
        st = bs_smiles_write(cx, home, marked, BS_SMILES_LABELS, out);
    bs_arena_rewind(&cx->scratch, temp);
    return st;
}

static bs_status copy_list(bs_ctx *cx, bs_arena *home, char *const *list, int count, char ***out)
{
    bs_status st = bs_new(cx, home, count + 1, out);

    for (int i = 0; i < count && st == BS_OK; i++)
        st = bs_copy_text(cx, home, list[i], strlen(list[i]), &(*out)[i]);
    return st;
}

static bs_status fill_reason(bs_ctx *cx, bs_arena *home, const bs_mol *product, bs_reason_kind kind,
                             const char *text, const uint32_t *atoms, int count, bs_reason *out)
{
    bs_status st;

    *out = (bs_reason){.kind = kind, .atom_count = count};
    if ((st = bs_copy_text(cx, home, text, strlen(text), &out->text)) != BS_OK ||
        (st = bs_new(cx, home, count + 1, &out->atoms)) != BS_OK)
        return st;
    if (count > 0)
        memcpy(out->atoms, atoms, (size_t)count * sizeof *atoms);
    return mark_atoms(cx, home, product, atoms, count, &out->marked);
}

/* Adds a reason unless the same was given; `*added` is NULL then, or if there are too many. */
static bs_status add_reason(why *w, bs_reason_kind kind, const char *text, const uint32_t *atoms,
                            int count, bs_reason **added)
{
    bs_reasons *out = w->out;

    *added = NULL;
    for (int i = 0; i < out->count; i++) {
        if (out->items[i].kind == kind && strcmp(out->items[i].text, text) == 0)
            return BS_OK;
    }
    if (out->count == MAX_REASONS)
        return BS_OK;
    *added = &out->items[out->count++];
    return fill_reason(w->cx, w->home, w->product, kind, text, atoms, count, *added);
}

/* ---- Places that were refused ---------------------------------------- */

static bs_status read_precursors(why *w, char *const *smiles, int count, const bs_mol ***out)
{
    bs_status st = bs_new(w->cx, &w->cx->scratch, count + 1, out);

    for (int i = 0; i < count && st == BS_OK; i++) {
        bs_mol *mol;

        st = bs_smiles_read(w->cx, &w->cx->scratch, smiles[i], strlen(smiles[i]), NULL, &mol);
        (*out)[i] = mol;
    }
    return st;
}

static bs_status join_products(why *w, const bs_outcome *outcome, char **out)
{
    bs_text text;
    bs_status st = BS_OK;

    bs_text_init(&text, w->cx);
    for (int i = 0; i < outcome->product_count && st == BS_OK; i++)
        st = bs_text_printf(&text, "%s%s", i > 0 ? "." : "", outcome->smiles[i]);
    if (st == BS_OK)
        st = bs_copy_text(w->cx, w->home, text.data ? text.data : "", text.length, out);
    bs_text_free(&text);
    return st;
}

/* What the precursors give when the transform is run forwards on them. */
static bs_status find_instead(why *w, char *const *smiles, int count, bs_reason *reason)
{
    const bs_mol **mols;
    bs_product_sets sets;
    bs_status st;

    if ((st = copy_list(w->cx, w->home, smiles, count, &reason->precursors)) != BS_OK ||
        (st = bs_new(w->cx, w->home, MAX_INSTEAD, &reason->instead)) != BS_OK ||
        (st = read_precursors(w, smiles, count, &mols)) != BS_OK)
        return st;
    reason->precursor_count = count;
    st = bs_rules_forth(w->cx, w->home, w->rules, w->transform, mols, count, w->hooks, &sets);
    for (int i = 0; i < sets.count && i < MAX_INSTEAD && st == BS_OK &&
                    sets.items[i].outcome.kind != BS_RIVAL_OVER;
         i++)
        st = join_products(w, &sets.items[i].outcome, &reason->instead[reason->instead_count++]);
    return st;
}

static bs_status put_list(bs_text *text, char *const *list, int count, const char *between)
{
    bs_status st = BS_OK;

    for (int i = 0; i < count && st == BS_OK; i++)
        st = bs_text_printf(text, "%s%s", i > 0 ? between : "", list[i]);
    return st;
}

static bs_status refuse_forward(why *w, const bs_site *site, char *const *smiles, int count)
{
    bs_reason found = {0}, *added;
    bs_text text;
    bs_status st = find_instead(w, smiles, count, &found);

    bs_text_init(&text, w->cx);
    if (st == BS_OK)
        st = put_list(&text, smiles, count, " + ");
    if (st == BS_OK && found.instead_count == 0)
        st = bs_text_puts(&text, " would not react by this rule");
    if (st == BS_OK && found.instead_count > 0) {
        st = bs_text_puts(&text, " would give ");
        if (st == BS_OK)
            st = put_list(&text, found.instead, found.instead_count, ", or ");
        if (st == BS_OK)
            st = bs_text_puts(&text, " instead");
    }
    if (st == BS_OK)
        st = add_reason(w, BS_REASON_FORWARD, text.data, site->atoms, site->count, &added);
    if (st == BS_OK && added) {
        added->precursors = found.precursors;
        added->precursor_count = found.precursor_count;
        added->instead = found.instead;
        added->instead_count = found.instead_count;
    }
    bs_text_free(&text);
    return st;
}

static bs_status refuse_place(void *payload, bs_ctx *cx, bs_refusal refusal, const bs_site *site,
                              char *const *smiles, int count)
{
    why *w = payload;
    bs_mark temp = bs_arena_mark(&cx->scratch);
    bs_reason *added;
    bs_status st;

    switch (refusal) {
    case BS_REFUSED_STRAINED:
        st = add_reason(w, BS_REASON_STRAIN,
                        "a precursor would have a multiple bond that its ring cannot hold",
                        site->atoms, site->count, &added);
        break;
    case BS_REFUSED_WHEN:
        st = add_reason(w, BS_REASON_WHEN, "the target fits, but the rule's `when` refuses it",
                        site->atoms, site->count, &added);
        break;
    case BS_REFUSED_SAME:
        st = add_reason(w, BS_REASON_SAME, "the product is among its own precursors", site->atoms,
                        site->count, &added);
        break;
    default:
        st = refuse_forward(w, site, smiles, count);
        break;
    }
    bs_arena_rewind(&cx->scratch, temp);
    return st;
}

/* ---- No place at all ---------------------------------------- */

static const bs_pattern *target_of(const bs_rules *rules, int transform)
{
    const bs_transform *tr = rules->transforms[transform];

    return tr->case_count > 0 ? tr->cases[0].target.patterns[0] : NULL;
}

static bs_status tell_near(bs_ctx *cx, bs_arena *home, const bs_mol *product, const bs_near *near,
                           bs_reason *out)
{
    uint32_t *atoms;
    int count = 0;
    bs_text text;
    bs_status st;

    if ((st = bs_new(cx, &cx->scratch, near->miss_count + 1, &atoms)) != BS_OK)
        return st;
    bs_text_init(&text, cx);
    for (int i = 0; i < near->miss_count && st == BS_OK; i++) {
        st = bs_text_printf(&text, "%s%s", i > 0 ? "; " : "", near->misses[i].text);
        if (near->misses[i].where != BS_UNPLACED)
            atoms[count++] = near->misses[i].where;
    }
    if (st == BS_OK)
        st = fill_reason(cx, home, product, BS_REASON_PATTERN, text.data ? text.data : "", atoms,
                         count, out);
    bs_text_free(&text);
    return st;
}

static bs_status explain_no_place(why *w)
{
    const bs_pattern *target = target_of(w->rules, w->transform);
    bs_reason *reason = &w->out->items[0], *added;
    bool fits = false, found;
    bs_near near;
    bs_status st;

    if (!target)
        return BS_OK;
    if ((st = bs_pattern_has(w->cx, target, w->product, &fits)) != BS_OK)
        return st;
    if (fits)
        return add_reason(w, BS_REASON_PRECURSOR,
                          "the target fits, but no sensible precursors come out of it "
                          "(valences, aromatic rings, or halves that hang together)",
                          NULL, 0, &added);
    if ((st = bs_near__find(w->cx, w->home, target, w->product, 0, &near, &found)) != BS_OK)
        return st;
    w->out->count = 1;
    if (near.miss_count > 0)
        return tell_near(w->cx, w->home, w->product, &near, reason);
    return fill_reason(w->cx, w->home, w->product, BS_REASON_PATTERN,
                       "atoms and bonds of the target fit, but not the geometry of its double bond",
                       NULL, 0, reason);
}

bs_status bs_rules_why(bs_ctx *cx, bs_arena *home, const bs_rules *rules, int transform,
                       const bs_mol *product, const bs_rule_hooks *hooks, bs_reasons *out)
{
    bs_mark kept = bs_arena_mark(home), temp = bs_arena_mark(&cx->scratch);
    why w = {.cx = cx,
             .home = home,
             .rules = rules,
             .transform = transform,
             .product = product,
             .hooks = hooks,
             .out = out};
    bs_watch watch = {&w, refuse_place};
    bs_arena work; /* of the steps: it is rewound behind each place, and the reasons have to stay */
    bs_steps steps;
    bs_status st;

    *out = (bs_reasons){0};
    if (transform < 0 || transform >= rules->transform_count)
        return bs_fail(cx, BS_ERANGE, "there is no transform number %d", transform);
    bs_arena_init(&work, cx->gate);
    if ((st = bs_new(cx, home, MAX_REASONS, &out->items)) == BS_OK)
        st = bs_back__watched(cx, &work, rules, transform, product, hooks, 0, &watch, &steps);
    if (st == BS_OK)
        out->step_count = steps.count;
    bs_arena_free(&work);
    if (st == BS_OK && steps.count == 0 && out->count == 0)
        st = explain_no_place(&w);
    bs_arena_rewind(&cx->scratch, temp);
    if (st != BS_OK) {
        bs_arena_rewind(home, kept);
        *out = (bs_reasons){0};
    }
    return st;
}

bs_status bs_rules_near_miss(bs_ctx *cx, bs_arena *home, const bs_rules *rules, int transform,
                             const bs_mol *product, bs_reason *out, int *size, bool *near)
{
    bs_mark temp = bs_arena_mark(&cx->scratch);
    const bs_pattern *target;
    bs_near found;
    bs_status st;

    *near = false;
    *size = 0;
    if (transform < 0 || transform >= rules->transform_count)
        return bs_fail(cx, BS_ERANGE, "there is no transform number %d", transform);
    target = target_of(rules, transform);
    if (!target)
        return BS_OK;
    *size = bs_pattern_atom_count(target);
    st = bs_near__find(cx, home, target, product, NEAR_MISS, &found, near);
    if (st == BS_OK && *near && found.miss_count == 0)
        *near = false;
    if (st == BS_OK && *near)
        st = tell_near(cx, home, product, &found, out);
    bs_arena_rewind(&cx->scratch, temp);
    return st;
}
