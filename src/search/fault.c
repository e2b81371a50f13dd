/*
 * Rules whose functions fail during a search: they are out for the rest of it.
 *
 * Which rule is out is decided where answers are merged, in their order. While a batch is expanded
 * all its molecules leave out the same rules, those known before it; so neither what a function is
 * asked nor what the search takes in depends on threads.
 */
#include "backsaw/format.h"
#include "search/plan.h"

#include <string.h>

void bs_plan__begin(void *payload)
{
    bs_plan_state *plan = payload;

    plan->batch_faults = plan->faults;
}

bs_status bs_plan__note_faults(bs_plan_state *plan, const bs_rule_faults *found)
{
    bs_status st = BS_OK;

    for (int i = 0; st == BS_OK && i < found->count; i++) {
        const bs_rule_fault *fault = &found->items[i];

        if (!bs_rule_faults_find(&plan->faults, fault->transform))
            st = bs_rule_faults_add(plan->cx, &plan->arena, &plan->faults, fault->transform,
                                    fault->message);
    }
    return st;
}

void bs_plan__strike(const bs_plan_state *plan, bs_proposals *found)
{
    int kept = 0;

    for (int i = 0; i < found->count; i++) {
        uint32_t tag = found->items[i].tag;

        if ((tag & BS_PLAN_KNOWN) || !bs_rule_faults_find(&plan->faults, (int)tag))
            found->items[kept++] = found->items[i];
    }
    found->count = kept;
}

bs_status bs_plan__warn(const bs_plan_state *plan, bs_routes *list)
{
    bs_status st = bs_new(plan->cx, &list->arena, plan->faults.count, &list->warnings);

    for (int i = 0; st == BS_OK && i < plan->faults.count; i++) {
        const bs_rule_fault *fault = &plan->faults.items[i];
        char *copy = NULL;
        bs_text text;

        bs_text_init(&text, plan->cx);
        st = bs_text_printf(&text, "transform '%s' is left out of the rest of the search: %s",
                            bs_rules_transform(plan->opts->rules, fault->transform)->name,
                            fault->message);
        if (st == BS_OK)
            st = bs_copy_text(plan->cx, &list->arena, text.data, text.length, &copy);
        bs_text_free(&text);
        list->warnings[i] = copy;
        list->warning_count = i + 1;
    }
    return st;
}
