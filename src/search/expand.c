/* What the exploration asks of chemistry: rules and known steps, prices, guesses. */
#include "backsaw/format.h"
#include "search/plan.h"

#include <math.h>
#include <string.h>

/* ---- Definitions ----------------------------------------------------------------------------- */

void bs_plan__fill_way(const bs_plan_state *plan, uint32_t tag, bs_route_way *way)
{
    const bs_transform_def *def;

    if (tag & BS_PLAN_KNOWN) {
        const bs_known *known = &plan->known[tag & ~BS_PLAN_KNOWN];

        *way = (bs_route_way){
            .transform = known->name, .rule = -1, .cost = known->cost, .yield = known->yield};
        return;
    }
    def = bs_rules_transform(plan->opts->rules, (int)tag);
    *way = (bs_route_way){
        .transform = def->name,
        .rule = (int)tag,
        .conditions = def->conditions,
        .recipe = def->recipe,
        .source = def->source,
        .pack = def->pack,
        .cautions = def->cautions,
        .reagents = def->reagents,
        .cost = plan->step_cost + def->step_cost,
        .yield_low = def->yield_low,
        .yield_high = def->yield_high,
        .yield = (def->yield_low + def->yield_high) / 2,
    };
    if (!(way->yield > 0 && way->yield <= 100))
        way->yield = BS_DEFAULT_YIELD;
}

bs_status bs_plan__rivals(bs_ctx *cx, bs_arena *home, const bs_outcomes *rivals, char ***out,
                          int *count)
{
    char **texts;
    bs_status st = bs_new(cx, home, rivals->count, &texts);

    for (int i = 0; st == BS_OK && i < rivals->count; i++) {
        const bs_outcome *set = &rivals->items[i];
        size_t length = 1;
        char *at;

        for (int j = 0; j < set->product_count; j++)
            length += strlen(set->smiles[j]) + 1;
        if ((st = bs_new(cx, home, length, &texts[i])) != BS_OK)
            break;
        at = texts[i];
        for (int j = 0; j < set->product_count; j++) {
            size_t part = strlen(set->smiles[j]);

            if (j > 0)
                *at++ = '.';
            memcpy(at, set->smiles[j], part);
            at += part;
        }
    }
    *out = texts;
    *count = rivals->count;
    return st;
}

/* ---- Expanding -------------------------------------------------------------------------------- */

/* A growing list of proposals in an arena. */
typedef struct list {
    bs_ctx *cx;
    bs_arena *home;
    bs_proposals *out;
    int room;
    const bs_rule_hooks *hooks;
} list;

static bs_status add(list *l, const bs_proposal *p)
{
    if (l->out->count == l->room) {
        int room = l->room ? l->room * 2 : 32;
        bs_proposal *items;
        bs_status st = bs_new(l->cx, l->home, room, &items);

        if (st != BS_OK)
            return st;
        if (l->out->count > 0)
            memcpy(items, l->out->items, (size_t)l->out->count * sizeof *items);
        l->out->items = items;
        l->room = room;
    }
    l->out->items[l->out->count++] = *p;
    return BS_OK;
}

static bs_status add_known(const bs_plan_state *plan, list *l, const char *smiles)
{
    size_t cursor = 0;
    const bs_known *known;
    int index;
    bs_status st = BS_OK;

    while (st == BS_OK && (known = bs_known__next(plan, smiles, &cursor, &index)) != NULL) {
        bs_proposal p = {
            .mols = known->mols,
            .smiles = known->smiles,
            .equivalents = known->equivalents,
            .count = known->count,
            .cost = known->cost,
            .yield = known->yield / 100,
            .tag = BS_PLAN_KNOWN | (uint32_t)index,
            .apart = true,
        };

        st = add(l, &p);
    }
    return st;
}

static bs_status add_steps(const bs_plan_state *plan, list *l, const bs_steps *steps)
{
    bs_status st = BS_OK;

    for (int i = 0; st == BS_OK && i < steps->count; i++) {
        const bs_step *step = &steps->items[i];
        bs_route_way way;
        bs_proposal p;
        int clashes;

        if ((st = bs_plan__count_clashes(plan, l->cx, step, &clashes)) != BS_OK)
            return st;
        if (clashes > 0 && plan->opts->clashes == BS_CLASH_REFUSE)
            continue;
        bs_plan__fill_way(plan, (uint32_t)step->transform, &way);
        p = (bs_proposal){
            .mols = (const bs_mol *const *)step->precursors,
            .smiles = (const char *const *)step->smiles,
            .equivalents = step->equivalents,
            .count = step->precursor_count,
            .cost = way.cost + clashes * plan->clash_cost,
            .yield = way.yield / 100,
            .tag = (uint32_t)step->transform,
            .origin = step,
        };
        st = add(l, &p);
    }
    return st;
}

/* Asks one transform, or with -1 all. A molecule that is too much for a rule has no such step. */
static bs_status ask_rules(const bs_plan_state *plan, list *l, const bs_mol *mol, int transform)
{
    const bs_plan_opts *opts = plan->opts;
    bs_steps steps = {NULL, 0};
    bs_status st = bs_rules_back(l->cx, l->home, opts->rules, transform, mol, l->hooks, 0,
                                 &steps);

    return st == BS_OK ? add_steps(plan, l, &steps) : st;
}

static bs_status add_ruled(const bs_plan_state *plan, list *l, const bs_mol *mol)
{
    const bs_plan_opts *opts = plan->opts;
    int count = opts->transforms ? opts->transform_count : bs_rules_count(opts->rules);
    bs_status st = BS_OK;

    if (!opts->transforms && (st = ask_rules(plan, l, mol, -1)) != BS_ELIMIT)
        return st;
    /* With all at once over the limit, those that stay within it are still asked. */
    st = BS_OK;
    for (int i = 0; st == BS_OK && i < count; i++) {
        st = ask_rules(plan, l, mol, opts->transforms ? opts->transforms[i] : i);
        if (st == BS_ELIMIT)
            st = BS_OK;
    }
    return st;
}

bs_status bs_plan__expand(void *payload, bs_ctx *cx, bs_arena *home, int lane,
                          const char *smiles, bool closed, bs_proposals *out)
{
    const bs_plan_state *plan = payload;
    const bs_plan_opts *opts = plan->opts;
    list l = {
        .cx = cx,
        .home = home,
        .out = out,
        .hooks = opts->lane_hooks ? &opts->lane_hooks[lane] : opts->hooks,
    };
    bs_mol *mol;
    bs_status st = add_known(plan, &l, smiles);

    if (st != BS_OK || closed || !plan->rules_on)
        return st;
    if (bs_smiles_read(cx, home, smiles, strlen(smiles), NULL, &mol) != BS_OK)
        return bs_fail(cx, BS_EBUG, "the canonical SMILES %s cannot be read again", smiles);
    return add_ruled(plan, &l, mol);
}

/* ---- Admitting --------------------------------------------------------------------------------- */

/* A proposal as a route of one step, in scratch; nothing is copied but the rivals. */
static bs_status show(const bs_plan_state *plan, bs_ctx *cx, const char *product,
                      const bs_proposal *p, bs_route **out)
{
    bs_arena *scratch = &cx->scratch;
    const bs_step *origin = p->origin;
    bs_route_step *step;
    bs_route *route;
    bs_status st;

    if ((st = bs_new(cx, scratch, 1, &route)) || (st = bs_new(cx, scratch, 1, &route->steps)) ||
        (st = bs_new(cx, scratch, p->count + 1, &route->molecules)))
        return st;
    step = route->steps;
    if ((st = bs_new(cx, scratch, p->count, &step->precursors)) ||
        (st = bs_new(cx, scratch, 1, &step->ways)) ||
        (st = bs_new(cx, scratch, p->count, &step->ways->equivalents)))
        return st;
    route->mode = plan->opts->mode;
    route->step_count = step->way_count = 1;
    route->molecule_count = p->count + 1;
    for (int i = 0; i <= p->count; i++)
        route->molecules[i] = (bs_route_molecule){
            .smiles = i ? p->smiles[i - 1] : product, .price = -1, .step = i ? -1 : 0};
    {
        double *equivalents = step->ways->equivalents;

        bs_plan__fill_way(plan, p->tag, step->ways);
        step->ways->equivalents = equivalents;
        step->ways->cost = p->cost;
    }
    step->precursor_count = p->count;
    for (int i = 0; i < p->count; i++) {
        step->precursors[i] = i + 1;
        step->ways->equivalents[i] = p->equivalents[i];
    }
    step->known = (p->tag & BS_PLAN_KNOWN) != 0;
    step->checked = !step->known;
    step->line = 1;
    step->runs = 1;
    *out = route;
    return origin ? bs_plan__rivals(cx, scratch, &origin->rivals, &step->rivals,
                                    &step->rival_count)
                  : BS_OK;
}

bs_status bs_plan__admit(void *payload, bs_ctx *cx, const char *product, bs_proposal *proposal,
                         bool *admitted)
{
    bs_plan_state *plan = payload;
    const bs_plan_opts *opts = plan->opts;
    bool priced = (proposal->tag & BS_PLAN_KNOWN) != 0 &&
                  plan->known[proposal->tag & ~BS_PLAN_KNOWN].has_cost;
    bs_mark temp = bs_arena_mark(&cx->scratch);
    bs_route *view;
    bs_status st = BS_OK;

    *admitted = true;
    if (!opts->allow && !opts->cost)
        return BS_OK;
    if ((st = show(plan, cx, product, proposal, &view)) == BS_OK && opts->allow)
        st = opts->allow(opts->payload, cx, view, admitted);
    if (st == BS_OK && *admitted && opts->cost && !priced) {
        st = opts->cost(opts->payload, cx, view, &proposal->cost);
        if (st == BS_OK && !(isfinite(proposal->cost) && proposal->cost >= 0))
            st = bs_fail(cx, BS_EVALUE, "cost: a step must cost a number of 0 or more");
    }
    if (st == BS_OK && *admitted) {
        plan->admitted_cost += proposal->cost;
        plan->admitted_count++;
    }
    bs_arena_rewind(&cx->scratch, temp);
    return st;
}

/* ---- Meeting ----------------------------------------------------------------------------------- */

static bool has_carbon(const bs_mol *mol)
{
    for (int i = 0; i < bs_mol_atom_count(mol); i++) {
        if (bs_mol_atom_element(mol, i) == 6)
            return true;
    }
    return false;
}

static bs_status find_price(const bs_plan_state *plan, bs_ctx *cx, const bs_mol *mol,
                            const char *smiles, double *price)
{
    bool found = !has_carbon(mol);
    double per_mole = 0;
    bs_status st = BS_OK;
    bs_arena home;

    bs_arena_init(&home, cx->gate);
    if (plan->opts->shelf) {
        st = bs_shelf_price(cx, &home, plan->opts->shelf, mol, smiles, &found, &per_mole, NULL);
        if (st == BS_EVALUE) { /* no molar mass, so no price a mole */
            found = false;
            st = BS_OK;
        }
        if (found && !(isfinite(per_mole) && per_mole >= 0))
            found = false;
    }
    *price = found ? per_mole : INFINITY;
    bs_arena_free(&home);
    return st;
}

/* What one step costs by and large: the unit of the default guess. */
static double guess_unit(const bs_plan_state *plan)
{
    double unit = plan->step_cost;

    if (plan->opts->cost && plan->admitted_count > 0)
        unit = plan->admitted_cost / plan->admitted_count;
    return unit > 0 ? unit : 1;
}

bs_status bs_plan__meet(void *payload, bs_ctx *cx, const bs_mol *mol, const char *smiles,
                        bs_meeting *out)
{
    bs_plan_state *plan = payload;
    const bs_plan_opts *opts = plan->opts;
    size_t cursor = 0;
    bs_status st = find_price(plan, cx, mol, smiles, &out->price);

    if (st != BS_OK)
        return st;
    out->urgent = bs_known__next(plan, smiles, &cursor, NULL) != NULL;
    out->closed = !plan->rules_on || out->price == 0 || !has_carbon(mol);
    out->guess = fmax(1, bs_guess__steps(&plan->guess, mol)) * guess_unit(plan);
    if (opts->guess && isinf(out->price)) {
        st = opts->guess(opts->payload, cx, mol, smiles, &out->guess);
        if (st == BS_OK && !(isfinite(out->guess) && out->guess >= 0))
            st = bs_fail(cx, BS_EVALUE, "guess: must be a number of 0 or more");
    }
    return st;
}
