/*
 * Running a transform forwards: the bonds of the target are made wherever the precursors fit, and
 * the tests of the target tell afterwards which products are the wanted ones.
 */
#include <string.h>

#include "rule/book.h"

enum { MAX_PLACES = 400, MAX_MADE = 1000, MAX_STEPS = 1000000, MAX_FORMS = 4 };

void bs_forward__init(bs_forward *run, bs_ctx *cx, bs_arena *home, const bs_transform *tr,
                      const bs_rule_hooks *hooks, bool judge)
{
    *run = (bs_forward){.tr = tr, .hooks = hooks, .judge = judge, .home = home};
    run->score = hooks && hooks->prefer && tr->def.hook_prefer >= 0;
    bs_seen__init(&run->seen, cx);
}

void bs_forward__free(bs_forward *run)
{
    bs_seen__free(&run->seen);
}

bs_status bs_site__fill(bs_ctx *cx, bs_arena *home, const bs_transform *tr, const uint32_t *atom_of,
                        bs_site *out)
{
    uint32_t *atoms;
    bs_status st = bs_new(cx, home, tr->map_count + 1, &atoms);

    for (int i = 0; i < tr->map_count && st == BS_OK; i++)
        atoms[i] = atom_of[tr->map_atoms[i]];
    *out = (bs_site){.maps = tr->maps, .atoms = atoms, .count = tr->map_count};
    return st;
}

/* ---- Judging -------------------------------------------------------------------------------- */

/* Whether every atom and bond of the target passes its tests where the reaction has put it. */
static bs_status target_passes(bs_ctx *cx, const bs_case *kase, const bs_mol *product,
                               const bs_spot *spots, bool *passes)
{
    const bs_side *target = &kase->target;
    const bs_pattern *pattern = target->patterns[0];
    bs_status st;

    *passes = false;
    for (int i = 0; i < target->atom_count; i++) {
        bool yes = false;

        if (spots[i].atom == BS_NOWHERE)
            return BS_OK;
        st = bs_pattern__atom_passes(cx, pattern, i, product, spots[i].atom, &yes);
        if (st != BS_OK || !yes)
            return st;
    }
    for (int i = 0; i < target->bond_count; i++) {
        int bond = bs_mol_bond_between(product, (int)spots[target->bonds[i].a].atom,
                                       (int)spots[target->bonds[i].b].atom);

        if (bond < 0 || !bs_pattern__bond_passes(pattern, i, product, (uint32_t)bond))
            return BS_OK;
    }
    *passes = true;
    return BS_OK;
}

static bs_status fill_site(bs_ctx *cx, const bs_forward *run, const bs_spot *spots, bs_site *site)
{
    uint32_t *atom_of;
    bs_status st = bs_new(cx, &cx->scratch, run->kase->target.atom_count + 1, &atom_of);

    if (st != BS_OK)
        return st;
    for (int i = 0; i < run->kase->target.atom_count; i++)
        atom_of[i] = spots[i].atom;
    return bs_site__fill(cx, &cx->scratch, run->tr, atom_of, site);
}

/* Asks the functions of the rule about a product that passes the tests of the target, or not. */
static bs_status ask_hooks(bs_ctx *cx, const bs_forward *run, const bs_result *result,
                           bool *expected, double *score)
{
    const bs_transform_def *def = &run->tr->def;
    const bs_rule_hooks *hooks = run->hooks;
    const bs_mol *product = result->products[0];
    bs_site site;
    bs_status st = fill_site(cx, run, result->spots, &site);

    if (st == BS_OK && *expected && hooks->when && def->hook_when >= 0)
        st = hooks->when(hooks->payload, cx, def->hook_when, product, &site, expected);
    if (st == BS_OK && run->score) {
        site.roles = def->prefer_roles;
        site.role_maps = def->prefer_maps;
        st = hooks->prefer(hooks->payload, cx, def->hook_prefer, product, &site, score);
    }
    return st;
}

static bs_status judge(bs_ctx *cx, const bs_forward *run, const bs_result *result, bool *expected,
                       double *score)
{
    bs_mark temp = bs_arena_mark(&cx->scratch);
    bs_status st = BS_OK;

    *expected = false;
    *score = 0;
    if (run->judge)
        st = target_passes(cx, run->kase, result->products[0], result->spots, expected);
    if (st == BS_OK && run->hooks && (run->score || (*expected && run->tr->def.hook_when >= 0)))
        st = ask_hooks(cx, run, result, expected, score);
    bs_arena_rewind(&cx->scratch, temp);
    return st;
}

/* ---- Collecting -------------------------------------------------------------------------------
 */

static bs_status make_room(bs_ctx *cx, bs_forward *run)
{
    bs_made_list *list = &run->made;
    int room = list->room ? list->room * 2 : 8;
    bs_made *items;
    bs_status st;

    if (list->count < list->room)
        return BS_OK;
    if ((st = bs_new(cx, run->home, room, &items)) != BS_OK)
        return st;
    if (list->count > 0)
        memcpy(items, list->items, (size_t)list->count * sizeof *items);
    list->items = items;
    list->room = room;
    return BS_OK;
}

/* Whether an atom that the reaction changes lies on the nitrogen that got the hydrogen. */
static bool moved_reacts(const bs_forward *run, const uint32_t *where)
{
    const bs_side *from = run->kase->forth.from;

    for (int i = 0; i < from->atom_count; i++) {
        if (from->atoms[i].part == run->moved_part && where[i] == run->moved_to &&
            run->kase->forth.active[i])
            return true;
    }
    return run->moved_part < 0;
}

static bs_status add_made(void *payload, bs_ctx *cx, const uint32_t *where, const bs_result *result,
                          bool *keep)
{
    bs_forward *run = payload;
    bool expected;
    double score;
    char **smiles;
    bs_made *made;
    int index;
    bs_status st;

    if (run->made.count >= MAX_MADE || !moved_reacts(run, where))
        return BS_OK;
    if ((st = bs_result__smiles(cx, run->home, result, &smiles)) != BS_OK ||
        (st = bs_seen__add(cx, &run->seen, smiles, result->product_count, &index, keep)) != BS_OK)
        return st;
    if (!*keep && !run->score && (!run->judge || run->made.items[index].expected))
        return BS_OK;
    if ((st = judge(cx, run, result, &expected, &score)) != BS_OK)
        return st;
    if (!*keep) {
        made = &run->made.items[index];
        made->expected = made->expected || expected;
        made->score = score > made->score ? score : made->score;
        return BS_OK;
    }
    if ((st = make_room(cx, run)) != BS_OK)
        return st;
    made = &run->made.items[run->made.count++];
    *made = (bs_made){.spots = result->spots, .expected = expected, .score = score};
    return bs_result__outcome(cx, run->home, run->kase->forth.from, where, run->reactant, result,
                              smiles, &made->outcome);
}

/* The same with each part in turn in the other forms of its azole. */
static bs_status run_forms(bs_ctx *cx, bs_forward *run, const bs_mol *const *mols,
                           const bs_run_opts *opts)
{
    bs_mark temp = bs_arena_mark(&cx->scratch);
    int parts = run->kase->source.part_count;
    const bs_mol **other;
    bs_status st = bs_new(cx, &cx->scratch, parts + 1, &other);

    for (int p = 0; p < parts && st == BS_OK; p++) {
        bs_azole_form forms[MAX_FORMS];
        int count;

        st = bs_azole__forms(cx, &cx->scratch, mols[p], forms, MAX_FORMS, &count);
        for (int k = 0; k < count && st == BS_OK; k++) {
            memcpy(other, mols, (size_t)parts * sizeof *other);
            other[p] = forms[k].mol;
            run->moved_part = p;
            run->moved_to = forms[k].nitrogen;
            st = bs_run__all(cx, run->home, &run->kase->forth, other, opts, add_made, run);
        }
    }
    bs_arena_rewind(&cx->scratch, temp);
    return st;
}

bs_status bs_forward__run(bs_ctx *cx, bs_forward *run, const bs_case *kase,
                          const bs_mol *const *mols, const uint32_t *reactant)
{
    bs_run_opts opts = {.limit = MAX_PLACES, .steps = MAX_STEPS};
    bs_status st;

    run->kase = kase;
    run->reactant = reactant;
    run->moved_part = -1;
    if ((st = bs_run__all(cx, run->home, &kase->forth, mols, &opts, add_made, run)) != BS_OK)
        return st;
    return run_forms(cx, run, mols, &opts);
}
