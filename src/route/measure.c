/* What a route amounts to, and whether two are the same. */
#include "backsaw/route.h"

#include <string.h>

void bs_route_measure(const bs_route *route, bs_route_measures *out)
{
    *out = (bs_route_measures){
        .steps = route->step_count,
        .cost = route->cost,
        .yield_low = 100,
        .yield = 100,
        .yield_high = 100,
        .checked = true,
    };
    for (int i = 0; i < route->molecule_count; i++)
        out->leaves += route->molecules[i].bought;
    for (int i = 0; i < route->step_count; i++)
        out->checked = out->checked && (route->steps[i].checked || route->steps[i].known);
    if (route->step_count > 0) {
        /* The last step makes the target, and every other step serves it. */
        const bs_route_step *last = &route->steps[route->step_count - 1];

        out->longest = last->line;
        out->runs = last->runs;
        out->yield_low = last->line_low;
        out->yield = last->line_yield;
        out->yield_high = last->line_high;
    }
}

static bool same_smiles(const bs_route *a, int i, const bs_route *b, int j)
{
    return strcmp(a->molecules[i].smiles, b->molecules[j].smiles) == 0;
}

static bool same_text(const char *a, const char *b)
{
    return strcmp(a ? a : "", b ? b : "") == 0;
}

/* Known steps with the same compounds are different steps if they are run differently. */
static bool same_notes(const bs_route_way *a, const bs_route_way *b)
{
    return same_text(a->transform, b->transform) && same_text(a->conditions, b->conditions) &&
           same_text(a->recipe, b->recipe);
}

bool bs_route_same_step(const bs_route *a, int i, const bs_route *b, int j)
{
    const bs_route_step *p = &a->steps[i], *q = &b->steps[j];

    if (p->precursor_count != q->precursor_count || p->known != q->known ||
        !same_smiles(a, p->product, b, q->product))
        return false;
    if (p->known && !same_notes(&p->ways[0], &q->ways[0]))
        return false;
    for (int k = 0; k < p->precursor_count; k++) {
        int l = 0;

        while (l < q->precursor_count && !same_smiles(a, p->precursors[k], b, q->precursors[l]))
            l++;
        if (l == q->precursor_count)
            return false;
    }
    return true;
}

bool bs_route_same(const bs_route *a, const bs_route *b)
{
    if (a->step_count != b->step_count || !same_smiles(a, 0, b, 0))
        return false;
    /* One step makes each molecule, so each step of a has at most one like it in b. */
    for (int i = 0; i < a->step_count; i++) {
        int j = 0;

        while (j < b->step_count && !bs_route_same_step(a, i, b, j))
            j++;
        if (j == b->step_count)
            return false;
    }
    return true;
}
