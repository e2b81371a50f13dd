/* Known steps: read from SMILES once, found by their product. */
#include "backsaw/format.h"
#include "search/plan.h"

#include <math.h>
#include <stdio.h>
#include <string.h>

#define PRODUCT_SEED 0x6B6E6F77u

/* Puts the place before a message from below and keeps its code and offset. */
static bs_status explain(bs_ctx *cx, bs_status st, int step, const char *field, int number)
{
    bs_error below = cx->error;
    char where[64];

    if (number > 0)
        snprintf(where, sizeof where, "known step %d: %s %d", step + 1, field, number);
    else
        snprintf(where, sizeof where, "known step %d: %s", step + 1, field);
    bs_fail(cx, st, "%s: %s", where, below.message);
    cx->error.offset = below.offset;
    return st;
}

static bs_status read_one(bs_plan_state *plan, const char *text, const bs_mol **mol,
                          const char **smiles)
{
    bs_mol *read = NULL;
    char *canonical = NULL;
    bs_status st;

    if (!text)
        return bs_fail(plan->cx, BS_EVALUE, "no SMILES given");
    st = bs_smiles_read(plan->cx, &plan->arena, text, strlen(text), NULL, &read);
    if (st == BS_OK)
        st = bs_smiles_canonical(plan->cx, &plan->arena, read, 0, &canonical);
    *mol = read;
    *smiles = canonical;
    return st;
}

/* Adds a precursor; one that is named twice counts twice. */
static void add_precursor(bs_known *known, const bs_mol *mol, const char *smiles, double count)
{
    int at = 0;

    while (at < known->count && strcmp(known->smiles[at], smiles) != 0)
        at++;
    if (at == known->count) {
        known->mols[at] = mol;
        known->smiles[at] = smiles;
        known->count++;
    }
    known->equivalents[at] += count;
}

static bs_status check_numbers(bs_plan_state *plan, const bs_known_step *def, int index)
{
    bs_ctx *cx = plan->cx;

    if (def->from_count < 1)
        return bs_fail(cx, BS_EVALUE, "known step %d: from: no precursor", index + 1);
    if (def->has_cost && !(isfinite(def->cost) && def->cost >= 0))
        return bs_fail(cx, BS_EVALUE, "known step %d: cost: must be a number of 0 or more",
                       index + 1);
    if (!(def->yield >= 0 && def->yield <= 100))
        return bs_fail(cx, BS_EVALUE, "known step %d: yield: must be above 0 and at most 100 %%",
                       index + 1);
    for (int i = 0; def->equivalents && i < def->from_count; i++) {
        if (!isfinite(def->equivalents[i]) || def->equivalents[i] <= 0)
            return bs_fail(cx, BS_EVALUE, "known step %d: equiv %d: must be above 0", index + 1,
                           i + 1);
    }
    return BS_OK;
}

static bs_status read_step(bs_plan_state *plan, const bs_known_step *def, int index)
{
    bs_ctx *cx = plan->cx;
    bs_known *known = &plan->known[index];
    const bs_mol *mol;
    bs_status st;

    if ((st = check_numbers(plan, def, index)) != BS_OK)
        return st;
    if ((st = read_one(plan, def->product, &mol, &known->product)) != BS_OK)
        return explain(cx, st, index, "product", 0);
    if ((st = bs_new(cx, &plan->arena, def->from_count, &known->smiles)) != BS_OK ||
        (st = bs_new(cx, &plan->arena, def->from_count, &known->mols)) != BS_OK ||
        (st = bs_new(cx, &plan->arena, def->from_count, &known->equivalents)) != BS_OK)
        return st;
    for (int i = 0; i < def->from_count; i++) {
        const char *smiles;

        if ((st = read_one(plan, def->from[i], &mol, &smiles)) != BS_OK)
            return explain(cx, st, index, "from", i + 1);
        add_precursor(known, mol, smiles, def->equivalents ? def->equivalents[i] : 1);
    }
    known->cost = def->has_cost ? def->cost : plan->step_cost;
    known->has_cost = def->has_cost;
    known->yield = def->yield > 0 ? def->yield : BS_DEFAULT_YIELD;
    known->name = def->name ? def->name : "known step";
    return bs_map_add(&plan->known_index,
                      bs_hash_bytes(known->product, strlen(known->product), PRODUCT_SEED),
                      (uint32_t)index);
}

bs_status bs_known__read(bs_plan_state *plan)
{
    const bs_plan_opts *opts = plan->opts;
    bs_status st;

    if (opts->known_count < 0 || opts->known_count > (1 << 30))
        return bs_fail(plan->cx, BS_EVALUE, "known: too many steps");
    st = bs_new(plan->cx, &plan->arena, opts->known_count, &plan->known);
    for (int i = 0; st == BS_OK && i < opts->known_count; i++)
        st = read_step(plan, &opts->known[i], i);
    return st;
}

const bs_known *bs_known__next(const bs_plan_state *plan, const char *product, size_t *cursor,
                               int *index)
{
    uint64_t key = bs_hash_bytes(product, strlen(product), PRODUCT_SEED);
    uint32_t at;

    while ((at = bs_map_next(&plan->known_index, key, cursor)) != BS_MAP_NONE) {
        if (strcmp(plan->known[at].product, product) == 0) {
            if (index)
                *index = (int)at;
            return &plan->known[at];
        }
    }
    return NULL;
}
