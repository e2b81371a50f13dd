/* Lists of routes: making one from routes at hand, freeing. */
#include "backsaw/route.h"

#include "route/copy.h"

void bs_routes_free(bs_ctx *cx, bs_routes *routes)
{
    if (!routes)
        return;
    bs_arena_free(&routes->arena);
    bs_gate_free(cx->gate, routes, sizeof *routes);
}

static bs_status copy_statements(bs_ctx *cx, const bs_routes *like, bs_routes *list)
{
    bs_arena *home = &list->arena;
    bs_status st;

    list->complete = like->complete;
    list->molecules = like->molecules;
    list->expanded = like->expanded;
    list->steps = like->steps;
    if ((st = bs_route__copy_string(cx, home, like->reason, &list->reason)) != BS_OK ||
        (st = bs_route__copy_string(cx, home, like->target, &list->target)) != BS_OK ||
        (st = bs_new(cx, home, like->gap_count, &list->gaps)) != BS_OK)
        return st;
    for (int i = 0; st == BS_OK && i < like->gap_count; i++) {
        list->gaps[i] = like->gaps[i];
        st = bs_route__copy_string(cx, home, like->gaps[i].smiles, &list->gaps[i].smiles);
    }
    list->gap_count = like->gap_count;
    return st;
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
