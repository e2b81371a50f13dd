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
    if ((st = read_one(plan, def->product, &known->product_mol, &known->product)) != BS_OK)
        return explain(cx, st, index, "product", 0);
    if ((st = bs_new(cx, &plan->arena, def->from_count, &known->entries)) != BS_OK ||
        (st = bs_new(cx, &plan->arena, def->from_count, &known->entry_equivalents)) != BS_OK ||
        (st = bs_new(cx, &plan->arena, def->from_count, &known->smiles)) != BS_OK ||
        (st = bs_new(cx, &plan->arena, def->from_count, &known->mols)) != BS_OK ||
        (st = bs_new(cx, &plan->arena, def->from_count, &known->equivalents)) != BS_OK)
        return st;
    for (int i = 0; i < def->from_count; i++) {
        const char *smiles;

        if ((st = read_one(plan, def->from[i], &mol, &smiles)) != BS_OK)
            return explain(cx, st, index, "from", i + 1);
        known->entries[i] = mol;
        known->entry_equivalents[i] = def->equivalents ? def->equivalents[i] : 1;
        add_precursor(known, mol, smiles, known->entry_equivalents[i]);
    }
    known->cost = def->has_cost ? def->cost : plan->step_cost;
    known->has_cost = def->has_cost;
    known->yield = def->yield > 0 ? def->yield : BS_DEFAULT_YIELD;
    known->name = def->name ? def->name : "known step";
    known->entry_count = def->from_count;
    known->given = def;
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

/* ---- Tags ------------------------------------------------------------------------------------ */

/* The map number that an atom of the tagged product has in the product of the known step. */
static bs_status find_labels(const bs_plan_state *plan, bs_ctx *cx, bs_arena *home,
                             const bs_known *known, const bs_mol *tagged, int *labels)
{
    int *rank, *known_rank, atoms = bs_mol_atom_count(tagged);
    bs_mol *plain;
    bs_status st = bs_tag__strip(cx, home, &plan->con.tags, tagged, &plain, NULL);

    if (st != BS_OK || (st = bs_mol_canonical_order(cx, home, plain, &rank)) != BS_OK ||
        (st = bs_mol_canonical_order(cx, home, known->product_mol, &known_rank)) != BS_OK)
        return st;
    for (int i = 0; i < atoms; i++) {
        for (int k = 0; k < bs_mol_atom_count(known->product_mol); k++) {
            if (known_rank[k] == rank[i])
                labels[i] = bs_mol_atom_label(known->product_mol, k);
        }
    }
    return BS_OK;
}

static int find_label(const bs_mol *mol, int label)
{
    for (int i = 0; label > 0 && i < bs_mol_atom_count(mol); i++) {
        if (bs_mol_atom_label(mol, i) == label)
            return i;
    }
    return -1;
}

/* Whether a tag is at the end of a marked bond that the compound has. */
static bool is_bound(const bs_plan_state *plan, const bs_mol *tagged, int tag)
{
    for (int i = 0; i < plan->con.bond_count; i++) {
        const bs_tagged_bond *bond = &plan->con.bonds[i];

        if ((bond->a == tag || bond->b == tag) && bs_tag__bonded(tagged, bond->a, bond->b))
            return true;
    }
    return false;
}

/* One precursor with the tags of the product's atoms that it has. */
static bs_status tag_entry(bs_ctx *cx, bs_arena *home, const bs_mol *entry, const bs_mol *tagged,
                           const int *labels, bool *found, bs_mol **mol, char **smiles)
{
    uint16_t *isotope;
    bs_status st = bs_new(cx, home, bs_mol_atom_count(entry), &isotope);

    if (st != BS_OK)
        return st;
    for (int i = 0; i < bs_mol_atom_count(tagged); i++) {
        int atom = bs_tag__of(tagged, i) >= 0 ? find_label(entry, labels[i]) : -1;

        if (atom < 0)
            continue;
        isotope[atom] = (uint16_t)bs_mol_atom_isotope(tagged, i);
        found[i] = true;
    }
    st = bs_tag__put(cx, home, entry, isotope, mol);
    return st == BS_OK ? bs_smiles_canonical(cx, home, *mol, 0, smiles) : st;
}

bs_status bs_known__tag(const bs_plan_state *plan, bs_ctx *cx, bs_arena *home,
                        const bs_known *known, const bs_mol *tagged, bs_proposal *p, bool *usable)
{
    int *labels, atoms = bs_mol_atom_count(tagged), n = known->entry_count;
    bs_known copy = {0};
    bool *found;
    bs_status st;

    *usable = true;
    if ((st = bs_new(cx, home, atoms, &labels)) != BS_OK ||
        (st = bs_new(cx, home, atoms, &found)) != BS_OK ||
        (st = bs_new(cx, home, n, &copy.smiles)) != BS_OK ||
        (st = bs_new(cx, home, n, &copy.mols)) != BS_OK ||
        (st = bs_new(cx, home, n, &copy.equivalents)) != BS_OK ||
        (st = find_labels(plan, cx, home, known, tagged, labels)) != BS_OK)
        return st;
    for (int i = 0; st == BS_OK && i < n; i++) {
        bs_mol *mol;
        char *smiles;

        st = tag_entry(cx, home, known->entries[i], tagged, labels, found, &mol, &smiles);
        if (st == BS_OK)
            add_precursor(&copy, mol, smiles, known->entry_equivalents[i]);
    }
    for (int i = 0; i < atoms; i++) {
        int tag = bs_tag__of(tagged, i);

        if (tag >= 0 && !found[i] && is_bound(plan, tagged, tag))
            *usable = false;
    }
    p->mols = copy.mols;
    p->smiles = copy.smiles;
    p->equivalents = copy.equivalents;
    p->count = copy.count;
    return st;
}
