/* Making a route from its parts: checks, order, costs and amounts. */
#include "backsaw/route.h"

#include "route/copy.h"

#include <math.h>

/* The parts as given, and what is found out about them. */
typedef struct builder {
    bs_ctx *cx;
    bs_cost_mode mode;
    const bs_route_molecule *molecules;
    const bs_route_step *steps;
    int molecule_count, step_count, target;
    int *maker;  /* by molecule: the step that makes it, or -1 */
    int *number; /* by molecule: its number in the route, or -1 */
    int *order;  /* molecules of the route in order; number[order[i]] is i */
    int *bench;  /* steps in bench order */
    int *next;   /* by step: the precursor to look at next; -1 before the first */
    int *stack;
    int ordered, benched;
} builder;

static bs_status check_way(builder *b, const bs_route_step *step, const bs_route_way *way)
{
    if (!isfinite(way->cost) || way->cost < 0)
        return bs_fail(b->cx, BS_EVALUE, "the cost of a step must be a number of 0 or more");
    if (!isfinite(way->yield) || way->yield <= 0)
        return bs_fail(b->cx, BS_EVALUE, "the yield of a step must be above 0");
    for (int i = 0; i < step->precursor_count; i++) {
        if (!way->equivalents || !isfinite(way->equivalents[i]) || way->equivalents[i] <= 0)
            return bs_fail(b->cx, BS_EVALUE, "equivalents must be above 0");
    }
    return BS_OK;
}

static bs_status check_step(builder *b, int index)
{
    const bs_route_step *step = &b->steps[index];
    bs_status st = BS_OK;

    if (step->product < 0 || step->product >= b->molecule_count)
        return bs_fail(b->cx, BS_EVALUE, "a step makes no molecule of the route");
    if (step->precursor_count < 1 || step->way_count < 1)
        return bs_fail(b->cx, BS_EVALUE, "a step needs a precursor and a way to run it");
    if (b->maker[step->product] >= 0)
        return bs_fail(b->cx, BS_EVALUE, "two steps make %s",
                       b->molecules[step->product].smiles);
    b->maker[step->product] = index;
    for (int i = 0; i < step->precursor_count; i++) {
        if (step->precursors[i] < 0 || step->precursors[i] >= b->molecule_count)
            return bs_fail(b->cx, BS_EVALUE, "a step needs no molecule of the route");
    }
    for (int i = 0; st == BS_OK && i < step->way_count; i++)
        st = check_way(b, step, &step->ways[i]);
    return st;
}

static bs_status check_parts(builder *b)
{
    bs_status st = BS_OK;

    if (b->molecule_count < 1 || b->target < 0 || b->target >= b->molecule_count)
        return bs_fail(b->cx, BS_EVALUE, "a route needs a target");
    for (int i = 0; i < b->molecule_count; i++) {
        b->maker[i] = -1;
        b->number[i] = -1;
    }
    for (int i = 0; st == BS_OK && i < b->step_count; i++)
        st = check_step(b, i);
    for (int i = 0; st == BS_OK && i < b->molecule_count; i++) {
        const bs_route_molecule *mol = &b->molecules[i];

        if (!mol->smiles)
            st = bs_fail(b->cx, BS_EVALUE, "a molecule of the route has no SMILES");
        else if (b->maker[i] < 0 && !(isfinite(mol->price) && mol->price >= 0))
            st = bs_fail(b->cx, BS_EVALUE, "%s is neither made nor sold", mol->smiles);
    }
    return st;
}

/* Numbers the molecules as they are first needed, breadth first from the target. */
static bs_status number_molecules(builder *b)
{
    b->order[b->ordered++] = b->target;
    b->number[b->target] = 0;
    for (int at = 0; at < b->ordered; at++) {
        int maker = b->maker[b->order[at]];

        for (int i = 0; maker >= 0 && i < b->steps[maker].precursor_count; i++) {
            int mol = b->steps[maker].precursors[i];

            if (b->number[mol] >= 0)
                continue;
            b->number[mol] = b->ordered;
            b->order[b->ordered++] = mol;
        }
    }
    for (int i = 0; i < b->step_count; i++) {
        if (b->number[b->steps[i].product] < 0)
            return bs_fail(b->cx, BS_EVALUE, "nothing needs the step that makes %s",
                           b->molecules[b->steps[i].product].smiles);
    }
    return BS_OK;
}

/*
 * Puts the steps in bench order: a walk from the target that writes a step when all that it needs
 * is written. next[] is -1 for a step not met, step_count of precursors + 1 for one that is done.
 */
static bs_status order_steps(builder *b)
{
    int depth = 0, root = b->maker[b->target];

    for (int i = 0; i < b->step_count; i++)
        b->next[i] = -1;
    if (root < 0)
        return BS_OK;
    b->stack[depth++] = root;
    b->next[root] = 0;
    while (depth > 0) {
        int at = b->stack[depth - 1], maker;
        const bs_route_step *step = &b->steps[at];

        if (b->next[at] == step->precursor_count) {
            b->next[at]++;
            b->bench[b->benched++] = at;
            depth--;
            continue;
        }
        maker = b->maker[step->precursors[b->next[at]++]];
        if (maker < 0 || b->next[maker] > b->steps[maker].precursor_count)
            continue;
        if (b->next[maker] >= 0)
            return bs_fail(b->cx, BS_EVALUE, "the steps run in a circle through %s",
                           b->molecules[b->steps[maker].product].smiles);
        b->next[maker] = 0;
        b->stack[depth++] = maker;
    }
    return BS_OK;
}

/* ---- Numbers ---------------------------------------------------------------------------- */

static double way_cost(const bs_route *route, const bs_route_step *step, const bs_route_way *way)
{
    double sum = way->cost;

    for (int i = 0; i < step->precursor_count; i++) {
        double cost = route->molecules[step->precursors[i]].cost;

        sum += route->mode == BS_COST_ADDITIVE ? cost : way->equivalents[i] * cost;
    }
    return route->mode == BS_COST_ADDITIVE ? sum : sum / (way->yield / 100);
}

/* Sorts the ways of a step by cost, those of the same cost as they were given. */
static void sort_ways(const bs_route *route, bs_route_step *step)
{
    for (int i = 1; i < step->way_count; i++) {
        bs_route_way way = step->ways[i];
        double cost = way_cost(route, step, &way);
        int at = i;

        for (; at > 0 && way_cost(route, step, &step->ways[at - 1]) > cost; at--)
            step->ways[at] = step->ways[at - 1];
        step->ways[at] = way;
    }
}

/*
 * The longest line that ends with a step, from the lines of the steps before it. With several of
 * the same length each end of the yield is the lowest among them.
 */
static void fill_line(const bs_route *route, bs_route_step *step)
{
    const bs_route_way *way = &step->ways[0];
    bool ranged = way->yield_high > 0;
    double low = 1, used = 1, high = 1;

    step->line = 0;
    step->runs = 1;
    for (int i = 0; i < step->precursor_count; i++) {
        int maker = route->molecules[step->precursors[i]].step;
        const bs_route_step *below;

        if (maker < 0)
            continue;
        below = &route->steps[maker];
        step->runs += below->runs;
        if (below->line > step->line)
            low = used = high = INFINITY;
        if (below->line >= step->line) {
            step->line = below->line;
            low = fmin(low, below->line_low / 100);
            used = fmin(used, below->line_yield / 100);
            high = fmin(high, below->line_high / 100);
        }
    }
    step->line++;
    step->line_low = low * (ranged ? way->yield_low : way->yield);
    step->line_yield = used * way->yield;
    step->line_high = high * (ranged ? way->yield_high : way->yield);
}

static void fill_numbers(bs_route *route)
{
    for (int i = 0; i < route->molecule_count; i++) {
        bs_route_molecule *mol = &route->molecules[i];

        mol->cost = mol->bought ? mol->price : 0;
        mol->moles = i == 0;
    }
    for (int i = 0; i < route->step_count; i++) {
        bs_route_step *step = &route->steps[i];

        sort_ways(route, step);
        route->molecules[step->product].cost = way_cost(route, step, &step->ways[0]);
        fill_line(route, step);
    }
    for (int i = route->step_count - 1; i >= 0; i--) {
        const bs_route_step *step = &route->steps[i];
        double runs = route->molecules[step->product].moles / (step->ways[0].yield / 100);

        for (int j = 0; j < step->precursor_count; j++)
            route->molecules[step->precursors[j]].moles += runs * step->ways[0].equivalents[j];
    }
    route->cost = route->molecules[0].cost;
    route->rank = route->cost;
}

static bs_status copy_parts(builder *b, bs_arena *home, bs_route *route)
{
    bs_status st;

    if ((st = bs_new(b->cx, home, b->ordered, &route->molecules)) != BS_OK ||
        (st = bs_new(b->cx, home, b->benched, &route->steps)) != BS_OK)
        return st;
    route->molecule_count = b->ordered;
    route->step_count = b->benched;
    for (int i = 0; st == BS_OK && i < b->ordered; i++) {
        bs_route_molecule *mol = &route->molecules[i];

        st = bs_route__copy_molecule(b->cx, home, &b->molecules[b->order[i]], mol);
        mol->bought = b->maker[b->order[i]] < 0;
        mol->step = -1;
        if (!mol->bought) {
            mol->price = -1;
            mol->offer = (bs_offer){.price_per_gram = -1, .container_g = -1, .lead_days = -1};
        }
    }
    for (int i = 0; st == BS_OK && i < b->benched; i++) {
        bs_route_step *step = &route->steps[i];

        st = bs_route__copy_step(b->cx, home, &b->steps[b->bench[i]], step);
        if (st != BS_OK)
            break;
        step->product = b->number[step->product];
        for (int j = 0; j < step->precursor_count; j++)
            step->precursors[j] = b->number[step->precursors[j]];
        route->molecules[step->product].step = i;
    }
    return st;
}

static bs_status take_room(builder *b)
{
    bs_arena *scratch = &b->cx->scratch;
    bs_status st;

    if (b->molecule_count < 0 || b->step_count < 0)
        return bs_fail(b->cx, BS_EVALUE, "a route needs a target");
    if ((st = bs_new(b->cx, scratch, b->molecule_count, &b->maker)) != BS_OK ||
        (st = bs_new(b->cx, scratch, b->molecule_count, &b->number)) != BS_OK ||
        (st = bs_new(b->cx, scratch, b->molecule_count, &b->order)) != BS_OK ||
        (st = bs_new(b->cx, scratch, b->step_count, &b->bench)) != BS_OK ||
        (st = bs_new(b->cx, scratch, b->step_count, &b->next)) != BS_OK)
        return st;
    return bs_new(b->cx, scratch, b->step_count, &b->stack);
}

bs_status bs_route_build(bs_ctx *cx, bs_arena *home, bs_cost_mode mode,
                         const bs_route_molecule *molecules, int molecule_count,
                         const bs_route_step *steps, int step_count, int target, bs_route **out)
{
    bs_mark kept = bs_arena_mark(home), temp = bs_arena_mark(&cx->scratch);
    builder b = {
        .cx = cx,
        .mode = mode,
        .molecules = molecules,
        .steps = steps,
        .molecule_count = molecule_count,
        .step_count = step_count,
        .target = target,
    };
    bs_route *route = NULL;
    bs_status st;

    *out = NULL;
    if ((st = take_room(&b)) != BS_OK || (st = check_parts(&b)) != BS_OK ||
        (st = number_molecules(&b)) != BS_OK || (st = order_steps(&b)) != BS_OK ||
        (st = bs_new(cx, home, 1, &route)) != BS_OK)
        goto done;
    route->mode = mode;
    if ((st = copy_parts(&b, home, route)) == BS_OK)
        fill_numbers(route);
done:
    bs_arena_rewind(&cx->scratch, temp);
    if (st != BS_OK)
        bs_arena_rewind(home, kept);
    else
        *out = route;
    return st;
}
