/* What a search saw, shared by the lists of routes that came of it. */
#include "backsaw/route.h"

#include <string.h>

bs_status bs_explored_new(bs_ctx *cx, long molecules, int transforms, bs_explored **out)
{
    bs_explored *explored = bs_gate_alloc(cx->gate, sizeof *explored);
    bs_status st;

    *out = NULL;
    if (!explored)
        return bs_fail_memory(cx);
    explored->holders = 1;
    bs_arena_init(&explored->arena, cx->gate);
    if ((st = bs_new(cx, &explored->arena, molecules, &explored->molecules)) != BS_OK ||
        (st = bs_new(cx, &explored->arena, transforms, &explored->transforms)) != BS_OK) {
        bs_explored_drop(cx, explored);
        return st;
    }
    explored->molecule_count = molecules;
    explored->transform_count = transforms;
    *out = explored;
    return BS_OK;
}

bs_explored *bs_explored_hold(bs_explored *explored)
{
    if (explored)
        explored->holders++;
    return explored;
}

void bs_explored_drop(bs_ctx *cx, bs_explored *explored)
{
    if (!explored || --explored->holders > 0)
        return;
    bs_arena_free(&explored->arena);
    bs_gate_free(cx->gate, explored, sizeof *explored);
}

const bs_explored_molecule *bs_explored_find(const bs_explored *explored, const char *smiles)
{
    for (long i = 0; explored && i < explored->molecule_count; i++) {
        if (strcmp(explored->molecules[i].smiles, smiles) == 0)
            return &explored->molecules[i];
    }
    return NULL;
}
