/* A search that is kept: made from options, run, run on, ranked anew (rerank.c). */
#include "search/session.h"

#include "backsaw/format.h"

#include <string.h>

/* ---- Options ----------------------------------------------------------------------------------
 */

/* A copy of an array of the caller, or NULL. */
static bs_status copy_array(bs_plan_state *plan, const void *from, int count, size_t size,
                            void *out)
{
    void *copy = NULL;
    bs_status st = BS_OK;

    if (from && count > 0)
        st = bs_new_array(plan->cx, &plan->arena, (size_t)count, size, &copy);
    if (copy)
        memcpy(copy, from, (size_t)count * size);
    else if (from && st == BS_OK)
        st = bs_new_array(plan->cx, &plan->arena, 1, size, &copy); /* empty is not NULL */
    memcpy(out, &copy, sizeof copy);
    return st;
}

#define COPY(plan, array, count) copy_array((plan), (array), (count), sizeof *(array), &(array))

static bs_status copy_known(bs_plan_state *plan)
{
    bs_plan_opts *o = &plan->own;
    bs_known_step *steps = NULL;
    bs_status st = copy_array(plan, o->known, o->known_count, sizeof *steps, &steps);

    o->known = steps;
    for (int i = 0; st == BS_OK && i < o->known_count; i++) {
        if ((st = COPY(plan, steps[i].from, steps[i].from_count)) == BS_OK &&
            (st = COPY(plan, steps[i].equivalents, steps[i].from_count)) == BS_OK &&
            (st = COPY(plan, steps[i].reagents.items, steps[i].reagents.count)) == BS_OK)
            st = COPY(plan, steps[i].cautions.items, steps[i].cautions.count);
    }
    return st;
}

static bs_status copy_constraints(bs_plan_state *plan)
{
    bs_plan_opts *o = &plan->own;
    bs_constraints *c = NULL;
    bs_status st = copy_array(plan, o->constraints, 1, sizeof *c, &c);

    o->constraints = c;
    if (st != BS_OK || !c)
        return st;
    if ((st = COPY(plan, c->avoid, c->avoid_count)) == BS_OK &&
        (st = COPY(plan, c->use, c->use_count)) == BS_OK &&
        (st = COPY(plan, c->at_most, c->at_most_count)) == BS_OK &&
        (st = COPY(plan, c->start, c->start_count)) == BS_OK &&
        (st = COPY(plan, c->not_bought, c->not_bought_count)) == BS_OK &&
        (st = COPY(plan, c->intact, c->intact_count)) == BS_OK &&
        (st = COPY(plan, c->keep, c->keep_count)) == BS_OK &&
        (st = COPY(plan, c->cut, c->cut_count)) == BS_OK)
        st = COPY(plan, c->first, c->first_count);
    return st;
}

static bs_status copy_options(bs_plan_state *plan)
{
    bs_status st;

    if (plan->own.known_count < 0 || plan->own.known_count > (1 << 30))
        return bs_fail(plan->cx, BS_EVALUE, "known: too many steps");
    if ((st = COPY(plan, plan->own.transforms, plan->own.transform_count)) == BS_OK &&
        (st = copy_known(plan)) == BS_OK)
        st = copy_constraints(plan);
    return st;
}

/* ---- Life -------------------------------------------------------------------------------------
 */

static bs_status read_target(bs_plan_state *plan, const bs_mol *target)
{
    bs_mol *mol;
    bs_status st = bs_smiles_canonical(plan->cx, &plan->arena, target, 0, &plan->smiles);

    if (st == BS_OK)
        st = bs_smiles_read(plan->cx, &plan->arena, plan->smiles, strlen(plan->smiles), NULL, &mol);
    if (st == BS_OK)
        plan->mol = mol;
    return st;
}

static bs_status start(bs_search *search, const bs_mol *target)
{
    bs_plan_state *plan = &search->plan;
    bs_status st = copy_options(plan);

    bs_plan__read_options(plan);
    if (st == BS_OK && (st = bs_constraint__init(plan, target, &target)) == BS_OK &&
        (st = bs_plan__start_counts(plan)) == BS_OK && (st = bs_known__read(plan)) == BS_OK &&
        (st = bs_guess__init(&plan->guess, plan->cx, plan->own.shelf)) == BS_OK)
        st = read_target(plan, target);
    return st;
}

bs_status bs_search_new(bs_ctx *cx, const bs_mol *target, const bs_plan_opts *opts, bs_search **out)
{
    bs_search *search;
    bs_status st;

    *out = NULL;
    if ((st = bs_plan__check(cx, opts)) != BS_OK)
        return st;
    if (!(search = bs_gate_alloc(cx->gate, sizeof *search)))
        return bs_fail_memory(cx);
    search->plan = (bs_plan_state){.cx = cx, .own = *opts};
    search->plan.opts = &search->plan.own;
    bs_arena_init(&search->plan.arena, cx->gate);
    bs_arena_init(&search->plan.con.product_home, cx->gate);
    bs_map_init(&search->plan.known_index, cx);
    bs_map_init(&search->plan.detail_index, cx);
    if ((st = start(search, target)) != BS_OK)
        bs_search_free(search);
    else
        *out = search;
    return st;
}

bs_plan_opts *bs_search_options(bs_search *search)
{
    return &search->plan.own;
}

bs_status bs_search_run(bs_search *search, bs_routes **out)
{
    bs_plan_state *plan = &search->plan;
    bs_status st;

    *out = NULL;
    if ((st = bs_plan__check(plan->cx, &plan->own)) != BS_OK)
        return st;
    bs_plan__read_options(plan);
    if ((st = bs_plan__explore(plan)) == BS_OK)
        st = bs_plan__finish(plan, out);
    return st;
}

void bs_search_free(bs_search *search)
{
    bs_plan_state *plan;
    bs_ctx *cx;

    if (!search)
        return;
    plan = &search->plan;
    cx = plan->cx;
    if (plan->x.cx)
        bs_explore__free(&plan->x);
    bs_guess__free(&plan->guess);
    bs_constraint__free(plan);
    bs_gate_free(cx->gate, plan->tallies, plan->tally_room * sizeof *plan->tallies);
    bs_map_free(&plan->known_index);
    bs_map_free(&plan->detail_index);
    bs_gate_free(cx->gate, plan->details, plan->detail_room * sizeof *plan->details);
    bs_arena_free(&plan->arena);
    bs_gate_free(cx->gate, search, sizeof *search);
}

bs_status bs_plan(bs_ctx *cx, const bs_mol *target, const bs_plan_opts *opts, bs_routes **out)
{
    bs_search *search;
    bs_status st;

    *out = NULL;
    if ((st = bs_search_new(cx, target, opts, &search)) == BS_OK)
        st = bs_search_run(search, out);
    bs_search_free(search);
    return st;
}
