/* What the search asks of the clash check. */
#include "backsaw/group.h"
#include "search/plan.h"

#include <stdio.h>
#include <string.h>

/* A molecule that is too much for a group's pattern has no known clashes. */
static bs_status find_clashes(const bs_plan_state *plan, bs_ctx *cx, bs_arena *home,
                              const bs_step *step, bs_clashes *out)
{
    bs_status st = bs_step_clashes(cx, home, plan->opts->rules, step, out);

    if (st == BS_ELIMIT)
        *out = (bs_clashes){0};
    return st == BS_ELIMIT ? BS_OK : st;
}

/* Clashes come before cautions. */
static int count_attacked(const bs_clashes *clashes)
{
    int count = 0;

    while (count < clashes->count && clashes->items[count].fate == BS_ATTACKED)
        count++;
    return count;
}

bs_status bs_plan__count_clashes(const bs_plan_state *plan, bs_ctx *cx, const bs_step *step,
                                 int *count)
{
    bs_clashes found;
    bs_arena home;
    bs_status st;

    *count = 0;
    if (plan->opts->clashes == BS_CLASH_ALLOW)
        return BS_OK;
    bs_arena_init(&home, cx->gate);
    if ((st = find_clashes(plan, cx, &home, step, &found)) == BS_OK)
        *count = count_attacked(&found);
    bs_arena_free(&home);
    return st;
}

bs_status bs_plan__name_clashes(const bs_plan_state *plan, bs_ctx *cx, bs_arena *home,
                                const bs_step *step, char ***names, int *count)
{
    bs_clashes found;
    bs_arena own;
    int all = 0;
    bs_status st;

    *count = 0;
    bs_arena_init(&own, cx->gate);
    if ((st = find_clashes(plan, cx, &own, step, &found)) == BS_OK) {
        all = count_attacked(&found);
        st = bs_new(cx, home, all + 1, names);
    }
    for (int i = 0; i < all && st == BS_OK; i++) {
        const bs_clash *clash = &found.items[i];
        char text[300];

        snprintf(text, sizeof text, "%s%s%s", clash->group, clash->other ? " with " : "",
                 clash->other ? clash->other : "");
        if ((st = bs_copy_text(cx, home, text, strlen(text), &(*names)[i])) == BS_OK)
            ++*count;
    }
    bs_arena_free(&own);
    return st;
}
