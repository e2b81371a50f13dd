/* Deep copies of routes. */
#include "route/copy.h"

#include <string.h>

bs_status bs_route__copy_string(bs_ctx *cx, bs_arena *home, const char *from, const char **to)
{
    char *copy = NULL;
    bs_status st = BS_OK;

    if (from)
        st = bs_copy_text(cx, home, from, strlen(from), &copy);
    *to = copy;
    return st;
}

/* Copies the strings of a list in place of those that the list points at. */
static bs_status copy_strings(bs_ctx *cx, bs_arena *home, const char *const **field, int count)
{
    const char **items;
    bs_status st;

    if (count <= 0) {
        *field = NULL;
        return BS_OK;
    }
    if ((st = bs_new(cx, home, count, &items)) != BS_OK)
        return st;
    for (int i = 0; st == BS_OK && i < count; i++)
        st = bs_route__copy_string(cx, home, (*field)[i], &items[i]);
    *field = items;
    return st;
}

bs_status bs_route__copy_molecule(bs_ctx *cx, bs_arena *home, const bs_route_molecule *from,
                                  bs_route_molecule *to)
{
    const char **strings[] = {&to->smiles, &to->offer.code, &to->offer.name, &to->offer.smiles,
                              &to->offer.ground};
    bs_status st = BS_OK;

    *to = *from;
    for (size_t i = 0; st == BS_OK && i < sizeof strings / sizeof *strings; i++)
        st = bs_route__copy_string(cx, home, *strings[i], strings[i]);
    return st;
}

static bs_status copy_way(bs_ctx *cx, bs_arena *home, bs_route_way *way, int precursors)
{
    const char **strings[] = {&way->transform, &way->conditions, &way->recipe, &way->source,
                              &way->pack};
    const double *equivalents = way->equivalents;
    bs_status st = BS_OK;

    for (size_t i = 0; st == BS_OK && i < sizeof strings / sizeof *strings; i++)
        st = bs_route__copy_string(cx, home, *strings[i], strings[i]);
    if (st == BS_OK)
        st = copy_strings(cx, home, &way->cautions.items, way->cautions.count);
    if (st == BS_OK)
        st = copy_strings(cx, home, &way->reagents.items, way->reagents.count);
    if (st == BS_OK)
        st = bs_new(cx, home, precursors, &way->equivalents);
    for (int i = 0; st == BS_OK && i < precursors; i++)
        way->equivalents[i] = equivalents[i];
    return st;
}

bs_status bs_route__copy_step(bs_ctx *cx, bs_arena *home, const bs_route_step *from,
                              bs_route_step *to)
{
    bs_status st;

    *to = *from;
    if ((st = bs_new(cx, home, from->precursor_count, &to->precursors)) != BS_OK ||
        (st = bs_new(cx, home, from->way_count, &to->ways)) != BS_OK ||
        (st = bs_new(cx, home, from->rival_count, &to->rivals)) != BS_OK ||
        (st = bs_new(cx, home, from->clash_count, &to->clashes)) != BS_OK)
        return st;
    for (int i = 0; i < from->precursor_count; i++)
        to->precursors[i] = from->precursors[i];
    for (int i = 0; st == BS_OK && i < from->way_count; i++) {
        to->ways[i] = from->ways[i];
        st = copy_way(cx, home, &to->ways[i], from->precursor_count);
    }
    for (int i = 0; st == BS_OK && i < from->rival_count; i++)
        st = bs_copy_text(cx, home, from->rivals[i], strlen(from->rivals[i]), &to->rivals[i]);
    for (int i = 0; st == BS_OK && i < from->clash_count; i++)
        st = bs_copy_text(cx, home, from->clashes[i], strlen(from->clashes[i]), &to->clashes[i]);
    return st;
}

bs_status bs_route_copy(bs_ctx *cx, bs_arena *home, const bs_route *route, bs_route **out)
{
    bs_mark kept = bs_arena_mark(home);
    bs_route *copy = NULL;
    bs_status st;

    *out = NULL;
    if ((st = bs_new(cx, home, 1, &copy)) != BS_OK)
        return st;
    *copy = *route;
    if ((st = bs_new(cx, home, route->molecule_count, &copy->molecules)) != BS_OK ||
        (st = bs_new(cx, home, route->step_count, &copy->steps)) != BS_OK)
        goto done;
    for (int i = 0; st == BS_OK && i < route->molecule_count; i++)
        st = bs_route__copy_molecule(cx, home, &route->molecules[i], &copy->molecules[i]);
    for (int i = 0; st == BS_OK && i < route->step_count; i++)
        st = bs_route__copy_step(cx, home, &route->steps[i], &copy->steps[i]);
done:
    if (st != BS_OK)
        bs_arena_rewind(home, kept);
    else
        *out = copy;
    return st;
}
