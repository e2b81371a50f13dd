/* Running the steps of a route again, with no regard to how they were found. */
#include "backsaw/format.h"
#include "backsaw/route.h"

#include <string.h>

/* Whether a step that a rule proposes has the precursors of the route's step. */
static bool has_precursors(const bs_route *route, const bs_route_step *step, const bs_step *found)
{
    if (found->precursor_count != step->precursor_count)
        return false;
    for (int i = 0; i < found->precursor_count; i++) {
        int j = 0;

        while (j < step->precursor_count &&
               strcmp(found->smiles[i], route->molecules[step->precursors[j]].smiles) != 0)
            j++;
        if (j == step->precursor_count)
            return false;
    }
    return true;
}

static int rule_of(const bs_route_way *way, const bs_rules *rules)
{
    return rules && way->transform ? bs_rules_find(rules, way->transform) : -1;
}

static bs_status verify_step(bs_ctx *cx, const bs_route *route, const bs_route_step *step,
                             const bs_rules *rules, const bs_rule_hooks *hooks, bool *good)
{
    const char *smiles = route->molecules[step->product].smiles;
    bs_arena home; /* not the scratch arena, which the callee rewinds */
    bs_steps found = {NULL, 0};
    bs_mol *product;
    int rule = rule_of(&step->ways[0], rules);
    bs_status st;

    *good = false;
    if (rule < 0)
        return BS_OK;
    bs_arena_init(&home, cx->gate);
    st = bs_smiles_read(cx, &home, smiles, strlen(smiles), NULL, &product);
    if (st == BS_OK)
        st = bs_rules_back(cx, &home, rules, rule, product, hooks, 0, &found);
    for (int i = 0; st == BS_OK && i < found.count; i++)
        *good = *good || has_precursors(route, step, &found.items[i]);
    bs_arena_free(&home);
    return st;
}

bs_status bs_route_verify(bs_ctx *cx, const bs_route *route, const bs_rules *rules,
                          const bs_rule_hooks *hooks, int *failed)
{
    *failed = -1;
    for (int i = 0; i < route->step_count; i++) {
        bool good = true;
        bs_status st = BS_OK;

        if (!route->steps[i].known)
            st = verify_step(cx, route, &route->steps[i], rules, hooks, &good);
        if (st != BS_OK)
            return st;
        if (!good) {
            *failed = i;
            return BS_OK;
        }
    }
    return BS_OK;
}

bs_status bs_route_recheck(bs_ctx *cx, bs_route *route, const bs_rules *rules,
                           const bs_rule_hooks *hooks)
{
    bs_status st = BS_OK;

    for (int i = 0; st == BS_OK && i < route->step_count; i++) {
        bs_route_step *step = &route->steps[i];

        step->checked = false;
        if (step->known)
            continue;
        for (int k = 0; k < step->way_count; k++)
            step->ways[k].rule = rule_of(&step->ways[k], rules);
        st = verify_step(cx, route, step, rules, hooks, &step->checked);
        if (st == BS_ELIMIT)
            st = BS_OK;
    }
    return st;
}
