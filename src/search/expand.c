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
            .transform = known->name,
            .rule = -1,
            .conditions = known->given->conditions,
            .recipe = known->given->recipe,
            .source = known->given->source,
            .cautions = known->given->cautions,
            .reagents = known->given->reagents,
            .cost = known->cost,
            .yield = known->yield,
        };
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

/* The products of one outcome, plain, joined by dots. */
static bs_status join_products(const bs_plan_state *plan, bs_ctx *cx, bs_arena *home,
                               const bs_outcome *set, char **out)
{
    bs_status st = BS_OK;
    bs_text text;

    bs_text_init(&text, cx);
    for (int i = 0; st == BS_OK && i < set->product_count; i++) {
        const char *plain;

        st = bs_tag__plain(cx, home, &plan->con.tags, set->smiles[i], &plain);
        if (st == BS_OK && i > 0)
            st = bs_text_putc(&text, '.');
        if (st == BS_OK)
            st = bs_text_puts(&text, plain);
    }
    if (st == BS_OK)
        st = bs_copy_text(cx, home, text.data ? text.data : "", text.length, out);
    bs_text_free(&text);
    return st;
}

bs_status bs_plan__rivals(const bs_plan_state *plan, bs_ctx *cx, bs_arena *home,
                          const bs_outcomes *rivals, char ***out, int *count)
{
    char **texts;
    bs_status st = bs_new(cx, home, rivals->count, &texts);

    for (int i = 0; st == BS_OK && i < rivals->count; i++)
        st = join_products(plan, cx, home, &rivals->items[i], &texts[i]);
    *out = texts;
    *count = rivals->count;
    return st;
}

/* ---- Expanding --------------------------------------------------------------------------------
 */

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
    const char *plain;
    bs_mol *tagged = NULL;
    int index;
    bs_status st = bs_tag__plain(l->cx, l->home, &plan->con.tags, smiles, &plain);

    if (st == BS_OK && plain != smiles)
        st = bs_smiles_read(l->cx, l->home, smiles, strlen(smiles), NULL, &tagged);
    while (st == BS_OK && (known = bs_known__next(plan, plain, &cursor, &index)) != NULL) {
        bool usable = true;
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

        if (tagged)
            st = bs_known__tag(plan, l->cx, l->home, known, tagged, &p, &usable);
        if (st == BS_OK && usable)
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
            .apart = plan->con.by_way,
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
    bs_status st = bs_rules_back(l->cx, l->home, opts->rules, transform, mol, l->hooks, 0, &steps);

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

bs_status bs_plan__expand(void *payload, bs_ctx *cx, bs_arena *home, int lane, const char *smiles,
                          bool closed, bs_proposals *out)
{
    const bs_plan_state *plan = payload;
    const bs_plan_opts *opts = plan->opts;
    const bs_rule_hooks *given = opts->lane_hooks ? &opts->lane_hooks[lane] : opts->hooks;
    bs_rule_hooks hooks = given ? *given : (bs_rule_hooks){0};
    list l = {.cx = cx, .home = home, .out = out, .hooks = &hooks};
    bs_plan_asked *asked;
    bs_mol *mol;
    bs_status st = add_known(plan, &l, smiles);

    if (st != BS_OK || closed || !plan->rules_on || (st = bs_new(cx, home, 1, &asked)) != BS_OK ||
        (st = bs_new(cx, home, bs_rules_count(opts->rules), &asked->tried)) != BS_OK)
        return st;
    asked->faults = plan->batch_faults;
    hooks.tried = asked->tried;
    hooks.faults = &asked->faults;
    out->extra = asked;
    if (bs_smiles_read(cx, home, smiles, strlen(smiles), NULL, &mol) != BS_OK)
        return bs_fail(cx, BS_EBUG, "the canonical SMILES %s cannot be read again", smiles);
    return add_ruled(plan, &l, mol);
}

/* ---- Admitting ---------------------------------------------------------------------------------
 */

/* A proposal as a route of one step, in `home`; nothing is copied but the rivals. */
static bs_status show(const bs_plan_state *plan, bs_ctx *cx, bs_arena *home, const char *product,
                      const bs_proposal *p, bs_route **out)
{
    const bs_step *origin = p->origin;
    bs_route_step *step;
    bs_route *route;
    bs_status st;

    if ((st = bs_new(cx, home, 1, &route)) || (st = bs_new(cx, home, 1, &route->steps)) ||
        (st = bs_new(cx, home, p->count + 1, &route->molecules)))
        return st;
    step = route->steps;
    if ((st = bs_new(cx, home, p->count, &step->precursors)) ||
        (st = bs_new(cx, home, 1, &step->ways)) ||
        (st = bs_new(cx, home, p->count, &step->ways->equivalents)))
        return st;
    route->mode = plan->opts->mode;
    route->step_count = step->way_count = 1;
    route->molecule_count = p->count + 1;
    for (int i = 0; i <= p->count; i++) {
        route->molecules[i] = (bs_route_molecule){.price = -1, .step = i ? -1 : 0};
        st = bs_tag__plain(cx, home, &plan->con.tags, i ? p->smiles[i - 1] : product,
                           &route->molecules[i].smiles);
        if (st != BS_OK)
            return st;
    }
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
    return origin
               ? bs_plan__rivals(plan, cx, home, &origin->rivals, &step->rivals, &step->rival_count)
               : BS_OK;
}

/* Tells the trace of a step. */
static bs_status trace_step(bs_plan_state *plan, bs_ctx *cx, const bs_route *view,
                            bs_verdict_of whose)
{
    static const char *const verdicts[] = {"taken", "constraint", "allow"};
    bs_plan_event event = {.kind = BS_EVENT_STEP, .route = view, .verdict = verdicts[whose]};

    return plan->opts->trace ? plan->opts->trace(plan->opts->payload, cx, &event) : BS_OK;
}

/* Asks the user's functions of a step that constraints admit. */
static bs_status ask(bs_plan_state *plan, bs_ctx *cx, const bs_route *view, bs_proposal *proposal,
                     bs_verdict_of *whose)
{
    const bs_plan_opts *opts = plan->opts;
    bool priced = (proposal->tag & BS_PLAN_KNOWN) != 0 &&
                  plan->known[proposal->tag & ~BS_PLAN_KNOWN].has_cost;
    bool allowed = true;
    bs_status st = opts->allow ? opts->allow(opts->payload, cx, view, &allowed) : BS_OK;

    if (!allowed)
        *whose = BS_REFUSED_BY_ALLOW;
    if (st == BS_OK && allowed && opts->cost && !priced) {
        st = opts->cost(opts->payload, cx, view, &proposal->cost);
        if (st == BS_OK && !(isfinite(proposal->cost) && proposal->cost >= 0))
            st = bs_fail(cx, BS_EVALUE, "cost: a step must cost a number of 0 or more");
    }
    if (st == BS_OK && allowed) {
        plan->admitted_cost += proposal->cost;
        plan->admitted_count++;
    }
    return st;
}

/* Shows a step to the user's functions and the trace. */
static bs_status show_around(bs_plan_state *plan, bs_ctx *cx, const char *product,
                             bs_proposal *proposal, bs_verdict_of *whose)
{
    const bs_plan_opts *opts = plan->opts;
    bs_arena home;
    bs_route *view;
    bs_status st;

    bs_arena_init(&home, cx->gate);
    st = show(plan, cx, &home, product, proposal, &view);
    if (st == BS_OK && *whose == BS_ADMITTED && (opts->allow || opts->cost))
        st = ask(plan, cx, view, proposal, whose);
    if (st == BS_OK) {
        view->steps[0].ways[0].cost = proposal->cost;
        st = trace_step(plan, cx, view, *whose);
    }
    bs_arena_free(&home);
    return st;
}

bs_status bs_plan__ask(bs_plan_state *plan, bs_ctx *cx, const char *product,
                       bs_proposal *proposal, bool *admitted)
{
    bs_verdict_of whose = BS_ADMITTED;
    bs_arena home;
    bs_route *view;
    bs_status st;

    bs_arena_init(&home, cx->gate);
    if ((st = show(plan, cx, &home, product, proposal, &view)) == BS_OK)
        st = ask(plan, cx, view, proposal, &whose);
    bs_arena_free(&home);
    *admitted = whose == BS_ADMITTED;
    return st;
}

bs_status bs_plan__admit(void *payload, bs_ctx *cx, const char *product, bs_proposal *proposal,
                         bool *admitted)
{
    bs_plan_state *plan = payload;
    const bs_plan_opts *opts = plan->opts;
    bs_verdict_of whose = BS_ADMITTED;
    bs_status st;

    *admitted = true;
    st = bs_constraint__admit(plan, cx, product, proposal, admitted);
    if (!*admitted)
        whose = BS_REFUSED_BY_CONSTRAINT;
    if (st == BS_OK && (opts->allow || opts->cost || opts->trace))
        st = show_around(plan, cx, product, proposal, &whose);
    *admitted = whose == BS_ADMITTED;
    return st == BS_OK ? bs_plan__count(plan, product, proposal->tag, whose) : st;
}

/* ---- Meeting -----------------------------------------------------------------------------------
 */

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

/* Meets a plain molecule; `mol` has its tags. */
static bs_status meet_plain(bs_plan_state *plan, bs_ctx *cx, const bs_mol *mol, const bs_mol *plain,
                            const char *smiles, bs_meeting *out)
{
    const bs_plan_opts *opts = plan->opts;
    size_t cursor = 0;
    bool may, must;
    bs_status st = find_price(plan, cx, plain, smiles, &out->price);

    if (st != BS_OK)
        return st;
    if (opts->leaf && isfinite(out->price)) {
        st = opts->leaf(opts->payload, cx, plain, smiles, out->price, &out->price);
        if (st == BS_OK && !(isfinite(out->price) && out->price >= 0))
            st = bs_fail(cx, BS_EVALUE, "leaf: must be a number of 0 or more");
        if (st != BS_OK)
            return st;
    }
    bs_constraint__offer(plan, mol, smiles, &may, &must);
    if (must && isinf(out->price))
        out->price = 0;
    if (!may)
        out->price = INFINITY;
    out->urgent = !must && bs_known__next(plan, smiles, &cursor, NULL) != NULL;
    out->closed = must || !plan->rules_on || out->price == 0 || !has_carbon(plain);
    out->guess = fmax(1, bs_guess__steps(&plan->guess, plain)) * guess_unit(plan);
    if (opts->guess && isinf(out->price)) {
        st = opts->guess(opts->payload, cx, plain, smiles, &out->guess);
        if (st == BS_OK && !(isfinite(out->guess) && out->guess >= 0))
            st = bs_fail(cx, BS_EVALUE, "guess: must be a number of 0 or more");
    }
    if (st == BS_OK && opts->trace) {
        bs_plan_event event = {.kind = BS_EVENT_MOLECULE, .smiles = smiles, .price = out->price};

        st = opts->trace(opts->payload, cx, &event);
    }
    return st;
}

bs_status bs_plan__meet(void *payload, bs_ctx *cx, const bs_mol *mol, const char *smiles,
                        bs_meeting *out)
{
    bs_plan_state *plan = payload;
    bs_mol *plain;
    char *text;
    bs_arena home;
    bs_status st;

    if (plan->con.tags.count == 0 || !bs_tag__is_tagged(smiles))
        return meet_plain(plan, cx, mol, mol, smiles, out);
    bs_arena_init(&home, cx->gate);
    st = bs_tag__strip(cx, &home, &plan->con.tags, mol, &plain, &text);
    if (st == BS_OK)
        st = meet_plain(plan, cx, mol, plain, text, out);
    bs_arena_free(&home);
    return st;
}
