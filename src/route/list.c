/* Lists of routes: making one from routes at hand, merging two, freeing. */
#include "backsaw/route.h"

#include "route/copy.h"

#include <string.h>

void bs_routes_free(bs_ctx *cx, bs_routes *routes)
{
    if (!routes)
        return;
    bs_explored_drop(cx, routes->saw);
    bs_arena_free(&routes->arena);
    bs_gate_free(cx->gate, routes, sizeof *routes);
}

static bs_status copy_packs(bs_ctx *cx, const bs_pack_name *packs, int count, bs_routes *list)
{
    bs_status st = bs_new(cx, &list->arena, count, &list->packs);

    for (int i = 0; st == BS_OK && i < count; i++) {
        st = bs_route__copy_string(cx, &list->arena, packs[i].name, &list->packs[i].name);
        if (st == BS_OK)
            st = bs_route__copy_string(cx, &list->arena, packs[i].version, &list->packs[i].version);
    }
    list->pack_count = count;
    return st;
}

static bs_status copy_warnings(bs_ctx *cx, const bs_routes *like, bs_routes *list)
{
    bs_status st = bs_new(cx, &list->arena, like->warning_count, &list->warnings);

    for (int i = 0; st == BS_OK && i < like->warning_count; i++)
        st = bs_route__copy_string(cx, &list->arena, like->warnings[i], &list->warnings[i]);
    list->warning_count = like->warning_count;
    return st;
}

static bs_status copy_statements(bs_ctx *cx, const bs_routes *like, bs_routes *list)
{
    bs_arena *home = &list->arena;
    bs_status st;

    list->complete = like->complete;
    list->saw = bs_explored_hold(like->saw);
    list->molecules = like->molecules;
    list->expanded = like->expanded;
    list->steps = like->steps;
    if ((st = bs_route__copy_string(cx, home, like->reason, &list->reason)) != BS_OK ||
        (st = bs_route__copy_string(cx, home, like->target, &list->target)) != BS_OK ||
        (st = copy_warnings(cx, like, list)) != BS_OK ||
        (st = bs_new(cx, home, like->gap_count, &list->gaps)) != BS_OK)
        return st;
    for (int i = 0; st == BS_OK && i < like->gap_count; i++) {
        list->gaps[i] = like->gaps[i];
        st = bs_route__copy_string(cx, home, like->gaps[i].smiles, &list->gaps[i].smiles);
    }
    list->gap_count = like->gap_count;
    return st == BS_OK ? copy_packs(cx, like->packs, like->pack_count, list) : st;
}

bs_status bs_routes_pick(bs_ctx *cx, const bs_route *const *items, int count, const bs_routes *like,
                         bs_routes **out)
{
    bs_routes *list = bs_gate_alloc(cx->gate, sizeof *list);
    bs_status st;

    *out = NULL;
    if (!list)
        return bs_fail_memory(cx);
    bs_arena_init(&list->arena, cx->gate);
    st = bs_new(cx, &list->arena, count, &list->items);
    for (int i = 0; st == BS_OK && i < count; i++)
        st = bs_route_copy(cx, &list->arena, items[i], &list->items[i]);
    list->count = count;
    if (st == BS_OK && like)
        st = copy_statements(cx, like, list);
    if (st != BS_OK)
        bs_routes_free(cx, list);
    else
        *out = list;
    return st;
}

/* ---- Packs --------------------------------------------------------------------------------- */

static bool names_pack(const bs_routes *routes, const char *name)
{
    for (int i = 0; i < routes->count; i++) {
        const bs_route *route = routes->items[i];

        for (int j = 0; j < route->step_count; j++) {
            for (int k = 0; k < route->steps[j].way_count; k++) {
                const char *pack = route->steps[j].ways[k].pack;

                if (pack && strcmp(pack, name) == 0)
                    return true;
            }
        }
    }
    return false;
}

bs_status bs_routes_set_packs(bs_ctx *cx, bs_routes *routes, const bs_pack_name *packs, int count)
{
    bs_mark temp = bs_arena_mark(&cx->scratch);
    bs_pack_name *used;
    int found = 0;
    bs_status st = bs_new(cx, &cx->scratch, count, &used);

    for (int i = 0; st == BS_OK && i < count; i++) {
        if (packs[i].name && names_pack(routes, packs[i].name))
            used[found++] = packs[i];
    }
    if (st == BS_OK)
        st = copy_packs(cx, used, found, routes);
    bs_arena_rewind(&cx->scratch, temp);
    return st;
}

/* ---- Merging ------------------------------------------------------------------------------- */

static bs_status check_alike(bs_ctx *cx, const bs_routes *a, const bs_routes *b)
{
    if (a->target && b->target && strcmp(a->target, b->target) != 0)
        return bs_fail(cx, BS_EVALUE, "merge: the routes are for different targets, %s and %s",
                       a->target, b->target);
    if (a->count > 0 && b->count > 0 && a->items[0]->mode != b->items[0]->mode)
        return bs_fail(cx, BS_EVALUE, "merge: costs per mole and additive costs do not compare");
    return BS_OK;
}

/* Puts a route behind all that cost no more, unless the list has it. */
static int insert(const bs_route **items, int count, const bs_route *route)
{
    int at = count;

    for (int i = 0; i < count; i++) {
        if (bs_route_same(items[i], route))
            return count;
    }
    for (; at > 0 && items[at - 1]->cost > route->cost; at--)
        items[at] = items[at - 1];
    items[at] = route;
    return count + 1;
}

static bool has_gap(const bs_gap *gaps, int count, const char *smiles)
{
    for (int i = 0; i < count; i++) {
        if (strcmp(gaps[i].smiles, smiles) == 0)
            return true;
    }
    return false;
}

static bool has_pack(const bs_pack_name *packs, int count, const bs_pack_name *pack)
{
    for (int i = 0; i < count; i++) {
        const char *version = packs[i].version ? packs[i].version : "";

        if (strcmp(packs[i].name, pack->name) == 0 &&
            strcmp(version, pack->version ? pack->version : "") == 0)
            return true;
    }
    return false;
}

static bs_status join_warnings(bs_ctx *cx, const bs_routes *a, const bs_routes *b, bs_routes *both)
{
    bs_status st = bs_new(cx, &cx->scratch, a->warning_count + b->warning_count, &both->warnings);

    for (int i = 0; st == BS_OK && i < a->warning_count; i++)
        both->warnings[i] = a->warnings[i];
    for (int i = 0; st == BS_OK && i < b->warning_count; i++) {
        bool there = false;

        for (int k = 0; k < a->warning_count; k++)
            there = there || strcmp(a->warnings[k], b->warnings[i]) == 0;
        if (!there)
            both->warnings[both->warning_count++] = b->warnings[i];
    }
    return st;
}

/* What both say of their searches; the parts lie in scratch, to be copied. */
static bs_status join_statements(bs_ctx *cx, const bs_routes *a, const bs_routes *b,
                                 bs_routes *both)
{
    bs_arena *scratch = &cx->scratch;
    bs_status st;

    *both = *a;
    both->target = a->target ? a->target : b->target;
    both->complete = a->complete && b->complete;
    both->saw = NULL; /* two searches saw different things */
    both->reason = a->reason ? a->reason : b->reason;
    both->molecules += b->molecules;
    both->expanded += b->expanded;
    both->steps += b->steps;
    if ((st = bs_new(cx, scratch, a->gap_count + b->gap_count, &both->gaps)) != BS_OK ||
        (st = bs_new(cx, scratch, a->pack_count + b->pack_count, &both->packs)) != BS_OK ||
        (st = join_warnings(cx, a, b, both)) != BS_OK)
        return st;
    for (int i = 0; i < a->gap_count; i++)
        both->gaps[i] = a->gaps[i];
    for (int i = 0; i < b->gap_count; i++) {
        if (!has_gap(a->gaps, a->gap_count, b->gaps[i].smiles))
            both->gaps[both->gap_count++] = b->gaps[i];
    }
    for (int i = 0; i < a->pack_count; i++)
        both->packs[i] = a->packs[i];
    for (int i = 0; i < b->pack_count; i++) {
        if (!has_pack(a->packs, a->pack_count, &b->packs[i]))
            both->packs[both->pack_count++] = b->packs[i];
    }
    return BS_OK;
}

bs_status bs_routes_merge(bs_ctx *cx, const bs_routes *a, const bs_routes *b, bs_routes **out)
{
    bs_mark temp = bs_arena_mark(&cx->scratch);
    const bs_route **items;
    bs_routes both;
    int count = 0;
    bs_status st;

    *out = NULL;
    if ((st = check_alike(cx, a, b)) != BS_OK ||
        (st = bs_new(cx, &cx->scratch, a->count + b->count, &items)) != BS_OK ||
        (st = join_statements(cx, a, b, &both)) != BS_OK)
        goto done;
    for (int i = 0; i < a->count; i++)
        count = insert(items, count, a->items[i]);
    for (int i = 0; i < b->count; i++)
        count = insert(items, count, b->items[i]);
    st = bs_routes_pick(cx, items, count, &both, out);
done:
    bs_arena_rewind(&cx->scratch, temp);
    return st;
}
