/* Rules whose functions failed. */
#include <string.h>

#include "backsaw/rule.h"

const bs_rule_fault *bs_rule_faults_find(const bs_rule_faults *faults, int transform)
{
    for (int i = 0; i < faults->count; i++) {
        if (faults->items[i].transform == transform)
            return &faults->items[i];
    }
    return NULL;
}

bs_status bs_rule_faults_add(bs_ctx *cx, bs_arena *home, bs_rule_faults *faults, int transform,
                             const char *message)
{
    bs_rule_fault *items;
    char *copy;
    bs_status st = bs_new(cx, home, faults->count + 1, &items);

    if (st == BS_OK)
        st = bs_copy_text(cx, home, message, strlen(message), &copy);
    if (st != BS_OK)
        return st;
    if (faults->count > 0)
        memcpy(items, faults->items, (size_t)faults->count * sizeof *items);
    items[faults->count] = (bs_rule_fault){transform, copy};
    faults->items = items;
    faults->count++;
    return BS_OK;
}
