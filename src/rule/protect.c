/* Protecting groups and incompatible pairs: definitions, and what to propose for a clash. */
#include <string.h>

#include "backsaw/format.h"
#include "backsaw/group.h"
#include "rule/book.h"

/* ---- Copies ---------------------------------------------------------------------------------- */

static bs_status copy_strings(bs_ctx *cx, bs_arena *home, const char ***strings, size_t count)
{
    bs_status st = BS_OK;

    for (size_t i = 0; i < count && st == BS_OK; i++)
        st = bs_rules__copy_string(cx, home, strings[i]);
    return st;
}

static bs_status copy_lists(bs_ctx *cx, bs_arena *home, bs_words **lists, size_t count)
{
    bs_status st = BS_OK;

    for (size_t i = 0; i < count && st == BS_OK; i++)
        st = bs_rules__copy_words(cx, home, lists[i]);
    return st;
}

static bs_status copy_protecting(bs_ctx *cx, bs_arena *home, bs_protecting_def *def)
{
    const char **strings[] = {&def->name,
                              &def->title,
                              &def->group,
                              &def->like,
                              &def->example,
                              &def->install_reagents,
                              &def->removal_reagents,
                              &def->remarks,
                              &def->source,
                              &def->pack,
                              &def->origin};
    bs_words *lists[] = {&def->guards, &def->installed_by, &def->removed_by};
    bs_status st = copy_strings(cx, home, strings, sizeof strings / sizeof *strings);

    return st == BS_OK ? copy_lists(cx, home, lists, sizeof lists / sizeof *lists) : st;
}

/* ---- Protecting groups -------------------------------------------------------------------------
 */

/* Resolves the classes that have a fate of their own. */
static bs_status read_fates(bs_ctx *cx, bs_rules *rules, bs_protecting *p)
{
    int total = 0;
    bs_status st = BS_OK;

    for (int i = 0; i < p->def.fate_count; i++)
        total += p->def.fates[i].groups.count;
    if ((st = bs_new(cx, &rules->arena, total + 1, &p->classes)) != BS_OK ||
        (st = bs_new(cx, &rules->arena, total + 1, &p->fates)) != BS_OK)
        return st;
    for (int i = 0; i < p->def.fate_count && st == BS_OK; i++) {
        const bs_fate_def *def = &p->def.fates[i];
        int *classes;

        st = bs_shelves__resolve(cx, &rules->arena, rules, BS_CONDITIONS, &def->groups,
                                 bs_fate_word(def->fate), &classes);
        for (int k = 0; k < def->groups.count && st == BS_OK; k++) {
            p->classes[p->class_count] = classes[k];
            p->fates[p->class_count++] = def->fate;
        }
    }
    p->def.fates = NULL; /* they are kept resolved */
    p->def.fate_count = 0;
    return st;
}

/* Whether the example can be read and shows the group that it should. */
static bs_status check_example(bs_ctx *cx, const bs_rules *rules, const bs_protecting *p)
{
    const char *text = p->def.example;
    bs_group_hits hits;
    bs_mol *mol;
    bs_arena home;
    bs_status st;

    if (!text)
        return bs_fail(cx, BS_EVALUE, "example: a protected compound as SMILES is expected");
    bs_arena_init(&home, cx->gate);
    st = bs_smiles_read(cx, &home, text, strlen(text), NULL, &mol);
    if (st == BS_OK && p->def.group) {
        st = bs_group_hits_of(cx, &home, rules, p->group, mol, &hits);
        if (st == BS_OK && hits.count == 0)
            st = bs_fail(cx, BS_EVALUE, "the molecule shows no group \"%.100s\"", p->def.group);
    }
    bs_arena_free(&home);
    return st == BS_OK ? st : bs_blame(cx, st, "example");
}

static bs_status resolve_protecting(bs_ctx *cx, bs_rules *rules, bs_protecting *p)
{
    const char *base = p->def.like ? p->def.like : p->def.group;
    bs_words one = {&base, 1};
    int *group;
    bs_status st;

    if (!base)
        return bs_fail(cx, BS_EVALUE, "either group or like is expected");
    if (p->def.guards.count == 0)
        return bs_fail(cx, BS_EVALUE, "guards: a group is expected");
    if ((st = bs_shelves__resolve(cx, &rules->arena, rules, BS_GROUPS, &one,
                                  p->def.like ? "like" : "group", &group)) != BS_OK ||
        (st = bs_shelves__resolve(cx, &rules->arena, rules, BS_GROUPS, &p->def.guards, "guards",
                                  &p->guards)) != BS_OK ||
        (st = bs_shelves__resolve(cx, &rules->arena, rules, BS_CONDITIONS, &p->def.installed_by,
                                  "installed_by", &p->installed_by)) != BS_OK ||
        (st = bs_shelves__resolve(cx, &rules->arena, rules, BS_CONDITIONS, &p->def.removed_by,
                                  "removed_by", &p->removed_by)) != BS_OK ||
        (st = read_fates(cx, rules, p)) != BS_OK)
        return st;
    p->group = group[0];
    return check_example(cx, rules, p);
}

bs_status bs_rules_add_protecting(bs_ctx *cx, bs_rules *rules, const bs_protecting_def *def)
{
    bs_mark kept = bs_arena_mark(&rules->arena);
    bs_protecting *p;
    int index;
    bs_status st =
        bs_shelves__place(cx, rules, BS_PROTECTING, def->name, NULL, NULL, def->pack, &index);

    if (st == BS_OK && (st = bs_new(cx, &rules->arena, 1, &p)) == BS_OK) {
        p->def = *def;
        if ((st = copy_protecting(cx, &rules->arena, &p->def)) == BS_OK)
            st = resolve_protecting(cx, rules, p);
    }
    if (st != BS_OK) {
        bs_arena_rewind(&rules->arena, kept);
        return st;
    }
    return bs_shelves__put(cx, rules, BS_PROTECTING, index, p);
}

bs_status bs_protecting__fate(bs_ctx *cx, const bs_rules *rules, const bs_protecting *p,
                              int conditions, bs_fate *fate)
{
    for (int i = 0; i < p->class_count; i++) {
        if (p->classes[i] == conditions) {
            *fate = p->fates[i];
            return BS_OK;
        }
    }
    return bs_rules_fate(cx, rules, p->group, conditions, fate, NULL);
}

/* ---- Pairs
 * --------------------------------------------------------------------------------------- */

static bs_status make_pair(bs_ctx *cx, bs_rules *rules, bs_pair *pair)
{
    bs_incompatible_def *def = &pair->def;
    const char **strings[] = {&def->name, &def->why, &def->source, &def->pack, &def->origin};
    bs_words *lists[] = {&def->one, &def->other, &def->conditions};
    bs_status st;

    if (def->one.count == 0 || def->other.count == 0)
        return bs_fail(cx, BS_EVALUE, "two lists of groups are expected");
    if ((st = copy_strings(cx, &rules->arena, strings, sizeof strings / sizeof *strings)) !=
            BS_OK ||
        (st = copy_lists(cx, &rules->arena, lists, sizeof lists / sizeof *lists)) != BS_OK ||
        (st = bs_shelves__resolve(cx, &rules->arena, rules, BS_GROUPS, &def->one, "the first list",
                                  &pair->one)) != BS_OK ||
        (st = bs_shelves__resolve(cx, &rules->arena, rules, BS_GROUPS, &def->other,
                                  "the second list", &pair->other)) != BS_OK)
        return st;
    return bs_shelves__resolve(cx, &rules->arena, rules, BS_CONDITIONS, &def->conditions,
                               "conditions", &pair->conditions);
}

bs_status bs_rules_add_incompatible(bs_ctx *cx, bs_rules *rules, const bs_incompatible_def *def)
{
    bs_mark kept = bs_arena_mark(&rules->arena);
    bs_pair *pair;
    int index;
    bs_status st = bs_shelves__place(cx, rules, BS_PAIRS, def->name, NULL, NULL, def->pack, &index);

    if (st == BS_OK && (st = bs_new(cx, &rules->arena, 1, &pair)) == BS_OK) {
        pair->def = *def;
        st = make_pair(cx, rules, pair);
    }
    if (st != BS_OK) {
        bs_arena_rewind(&rules->arena, kept);
        return st;
    }
    return bs_shelves__put(cx, rules, BS_PAIRS, index, pair);
}

/* ---- Proposals
 * ----------------------------------------------------------------------------------- */

typedef struct proposer {
    bs_ctx *cx;
    bs_arena *home;
    const bs_rules *rules;
    const bs_step *step;
    const bs_mol *product;
    const bs_clashes *clashes;
    int conditions; /* of the step, or -1 */
} proposer;

static bool guards(const proposer *q, const bs_protecting *p, int group)
{
    for (int i = 0; i < p->def.guards.count; i++) {
        if (bs_group__distance(bs_shelves__group(q->rules, group), group, p->guards[i]) >= 0)
            return true;
    }
    return false;
}

/* Whether a class attacks nothing in a molecule but the atoms marked. */
static bs_status is_harmless(const proposer *q, const bs_mol *mol, const bool *marked, int class,
                             bool *yes)
{
    bs_clashes found;
    bs_arena home;
    bs_status st;

    bs_arena_init(&home, q->cx->gate);
    st = bs_clashes_find(q->cx, &home, q->rules, mol, class, marked, &found);
    *yes = st == BS_OK && (found.count == 0 || found.items[0].fate != BS_ATTACKED);
    bs_arena_free(&home);
    return st;
}

/* Marks what the protecting group would cover in the precursor: all that clashes and is guarded. */
static bs_status mark_clashes(const proposer *q, const bs_protecting *p, int precursor, bool **out)
{
    const bs_mol *mol = q->step->precursors[precursor];
    bs_status st = bs_new(q->cx, &q->cx->scratch, bs_mol_atom_count(mol) + 1, out);

    for (int i = 0; i < q->clashes->count && st == BS_OK; i++) {
        const bs_clash *clash = &q->clashes->items[i];

        if (clash->precursor != precursor || clash->fate != BS_ATTACKED || clash->other ||
            !guards(q, p, clash->group_index))
            continue;
        for (int k = 0; k < clash->count; k++)
            (*out)[clash->atoms[k]] = true;
    }
    return st;
}

/* Marks the guarded groups of the product, which are set free there. */
static bs_status mark_guarded(const proposer *q, const bs_protecting *p, bool **out)
{
    bs_group_hits hits;
    bs_arena home;
    bs_status st = bs_new(q->cx, &q->cx->scratch, bs_mol_atom_count(q->product) + 1, out);

    if (st != BS_OK)
        return st;
    bs_arena_init(&home, q->cx->gate);
    st = bs_groups_find(q->cx, &home, q->rules, q->product, &hits);
    for (int i = 0; i < hits.count && st == BS_OK; i++) {
        for (int k = 0; k < hits.items[i].count && guards(q, p, hits.items[i].group); k++)
            (*out)[hits.items[i].atoms[k]] = true;
    }
    bs_arena_free(&home);
    return st;
}

/* The first class of a list that is harmless, or -1. */
static bs_status first_harmless(const proposer *q, const bs_mol *mol, const bool *marked,
                                const int *classes, int count, int *out)
{
    bs_status st = BS_OK;

    *out = -1;
    for (int i = 0; i < count && *out < 0 && st == BS_OK; i++) {
        bool yes;

        st = is_harmless(q, mol, marked, classes[i], &yes);
        if (yes)
            *out = classes[i];
    }
    return st;
}

static bs_status try_protecting(const proposer *q, int clash, int index, bs_fate wanted,
                                bs_protections *out)
{
    const bs_protecting *p = bs_shelves__protecting(q->rules, index);
    const bs_clash *own = &q->clashes->items[clash];
    bs_protection found = {.clash = clash, .protecting = index, .fate = BS_SURVIVES};
    bs_mark temp = bs_arena_mark(&q->cx->scratch);
    bool *marked;
    bs_status st = BS_OK;

    if (!guards(q, p, own->group_index))
        return BS_OK;
    if (q->conditions >= 0)
        st = bs_protecting__fate(q->cx, q->rules, p, q->conditions, &found.fate);
    if (st != BS_OK || found.fate != wanted)
        return st;
    if ((st = mark_clashes(q, p, own->precursor, &marked)) == BS_OK)
        st = first_harmless(q, q->step->precursors[own->precursor], marked, p->installed_by,
                            p->def.installed_by.count, &found.installed_by);
    if (st == BS_OK && found.installed_by >= 0 && (st = mark_guarded(q, p, &marked)) == BS_OK)
        st = first_harmless(q, q->product, marked, p->removed_by, p->def.removed_by.count,
                            &found.removed_by);
    bs_arena_rewind(&q->cx->scratch, temp);
    if (st == BS_OK && found.installed_by >= 0 && found.removed_by >= 0)
        out->items[out->count++] = found;
    return st;
}

bs_status bs_step_protections(bs_ctx *cx, bs_arena *home, const bs_rules *rules,
                              const bs_step *step, const bs_mol *product, const bs_clashes *clashes,
                              bs_protections *out)
{
    const char *conditions = bs_rules_transform(rules, step->transform)->conditions;
    proposer q = {.cx = cx,
                  .home = home,
                  .rules = rules,
                  .step = step,
                  .product = product,
                  .clashes = clashes,
                  .conditions = -1};
    int known = bs_rules_protecting_count(rules);
    bs_status st = bs_new(cx, home, (size_t)known * (size_t)clashes->count + 1, &out->items);

    out->count = 0;
    if (conditions)
        q.conditions = bs_rules_find_conditions(rules, conditions);
    for (int i = 0; i < clashes->count && st == BS_OK; i++) {
        if (clashes->items[i].fate != BS_ATTACKED || clashes->items[i].other)
            continue;
        for (int pass = 0; pass < 2; pass++) {
            for (int k = 0; k < known && st == BS_OK; k++)
                st = try_protecting(&q, i, k, pass == 0 ? BS_SURVIVES : BS_SLOW, out);
        }
    }
    return st;
}
