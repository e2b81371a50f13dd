/*
 * The forward check of a step: the reaction, run on the precursors, has to give the product.
 *
 * A reaction that makes a stereocentre without saying which hand gives the product without the
 * mark. That counts as the product too, and the verdict says that its stereo is left open: the
 * marks that differ must all be at atoms of the site, on one side only. Centres that the rule does
 * make with a mark say how they stand to each other; the product may have all of them turned.
 */
#include <string.h>

#include "backsaw/format.h"
#include "chem/mol.h"
#include "rule/book.h"

enum { MAX_PERMUTED = 4 };

/* ---- Comparing with some stereo left out ----------------------------------------------------- */

static bool has_geometry(const bs_mol *mol, int bond)
{
    return bond >= 0 && (bs_mol__bonds(mol)[bond].flags & (BS_BOND_CIS | BS_BOND_TRANS)) != 0;
}

/* Removes the stereo elements whose centre is marked, or both ends of whose double bond are one. */
static void strip(bs_draft *draft, const uint8_t *centres, const uint32_t *partner)
{
    for (uint32_t i = 0; i < draft->stereo_count; i++) {
        bs_draft_stereo *element = &draft->stereo[i];

        if (element->kind == BS_DRAFT_DOUBLE) {
            if (partner[element->centre] == element->second ||
                partner[element->second] == element->centre)
                element->perm = 0;
        } else if (centres[element->centre]) {
            element->perm = 0;
        }
    }
}

/* The canonical SMILES of `mol` without the marked elements, in scratch memory. */
static bs_status stripped_smiles(bs_ctx *cx, const bs_mol *mol, const uint8_t *centres,
                                 const uint32_t *partner, char **out)
{
    bs_draft draft;
    bs_mol *bare;
    bs_status st;

    bs_draft_init(&draft, cx, &cx->scratch);
    if ((st = bs_draft_from_mol(&draft, mol)) != BS_OK)
        return st;
    strip(&draft, centres, partner);
    if ((st = bs_draft_finish(&draft, &cx->scratch, NULL, &bare)) != BS_OK)
        return st;
    return bs_smiles_canonical(cx, &cx->scratch, bare, 0, out);
}

/*
 * Marks the elements of `mol` at the site that `other` lacks. `spots` and `others` tell where the
 * atoms of the target lie in each. Returns how many there are.
 */
static int find_extra(const bs_side *target, const bs_mol *mol, const uint32_t *spots,
                      const bs_mol *other, const uint32_t *others, uint8_t *centres,
                      uint32_t *partner)
{
    int count = 0;

    for (uint32_t i = 0; i < mol->atom_count; i++)
        partner[i] = UINT32_MAX;
    for (int i = 0; i < target->atom_count; i++) {
        if (spots[i] == BS_NOWHERE || others[i] == BS_NOWHERE)
            continue;
        if (mol->atoms[spots[i]].stereo != BS_STEREO_NONE &&
            other->atoms[others[i]].stereo == BS_STEREO_NONE) {
            centres[spots[i]] = 1;
            count++;
        }
    }
    for (int i = 0; i < target->bond_count; i++) {
        int a = target->bonds[i].a, b = target->bonds[i].b;

        if (spots[a] == BS_NOWHERE || spots[b] == BS_NOWHERE || others[a] == BS_NOWHERE ||
            others[b] == BS_NOWHERE)
            continue;
        if (has_geometry(mol, bs_mol_bond_between(mol, (int)spots[a], (int)spots[b])) &&
            !has_geometry(other, bs_mol_bond_between(other, (int)others[a], (int)others[b]))) {
            partner[spots[a]] = spots[b];
            count++;
        }
    }
    return count;
}

/* The SMILES of `mol` without what it says more than `other` at the site, or NULL if nothing. */
static bs_status bare_smiles(bs_ctx *cx, const bs_side *target, const bs_mol *mol,
                             const uint32_t *spots, const bs_mol *other, const uint32_t *others,
                             char **out)
{
    uint8_t *centres;
    uint32_t *partner;
    bs_status st;

    *out = NULL;
    if ((st = bs_new(cx, &cx->scratch, mol->atom_count + 1, &centres)) != BS_OK ||
        (st = bs_new(cx, &cx->scratch, mol->atom_count + 1, &partner)) != BS_OK)
        return st;
    if (find_extra(target, mol, spots, other, others, centres, partner) == 0)
        return BS_OK;
    return stripped_smiles(cx, mol, centres, partner, out);
}

/* Whether a forward product is the product but for stereo that only one of them states. */
static bs_status same_but_stereo(bs_ctx *cx, const bs_case *kase, const bs_made *made,
                                 const bs_mol *product, const char *product_smiles,
                                 const uint32_t *where, bool *same)
{
    bs_mark temp = bs_arena_mark(&cx->scratch);
    const bs_side *target = &kase->target;
    const bs_mol *other = made->outcome.products[0];
    uint32_t *spots;
    char *a, *b;
    bs_status st;

    *same = false;
    if (other->atom_count != product->atom_count)
        return BS_OK;
    if ((st = bs_new(cx, &cx->scratch, target->atom_count + 1, &spots)) != BS_OK)
        return st;
    for (int i = 0; i < target->atom_count; i++)
        spots[i] = made->spots[i].atom;
    st = bare_smiles(cx, target, product, where, other, spots, &a);
    if (st == BS_OK)
        st = bare_smiles(cx, target, other, spots, product, where, &b);
    if (st == BS_OK && (a || b))
        *same = strcmp(a ? a : product_smiles, b ? b : made->outcome.smiles[0]) == 0;
    bs_arena_rewind(&cx->scratch, temp);
    return st;
}

/* ---- The other hand
 * ------------------------------------------------------------------------------ */

/* Whether the rule makes a centre at this slot. */
static bool is_made(const bs_reading *forth, int slot)
{
    const bs_addition *addition = &forth->addition;

    for (int i = 0; i < forth->hand_edits; i++) {
        if (forth->hands[i].way == BS_HAND_MAKE && forth->hands[i].slot == slot)
            return true;
    }
    return addition->way != BS_ADDITION_NONE && (slot == addition->x || slot == addition->y);
}

/*
 * The product of a forward run with all centres turned that the rule makes: what the mirror image
 * of the reagent gives, or an attack from the other face. `*out` is NULL if the rule makes none.
 */
static bs_status turned_product(bs_ctx *cx, const bs_case *kase, const bs_made *made, bs_mol **out)
{
    const bs_mol *mol = made->outcome.products[0];
    const bs_reading *forth = &kase->forth;
    int turned = 0;
    bs_draft draft;
    bs_status st;

    *out = NULL;
    bs_draft_init(&draft, cx, &cx->scratch);
    if ((st = bs_draft_from_mol(&draft, mol)) != BS_OK)
        return st;
    for (int k = 0; k < forth->to->atom_count; k++) {
        if (!is_made(forth, forth->to_slot[k]))
            continue;
        for (uint32_t n = 0; n < draft.stereo_count; n++) {
            bs_draft_stereo *element = &draft.stereo[n];

            if (element->kind != BS_STEREO_TETRAHEDRAL || element->centre != made->spots[k].atom)
                continue;
            element->perm = (uint8_t)(3 - element->perm);
            turned++;
        }
    }
    return turned > 0 ? bs_draft_finish(&draft, &cx->scratch, NULL, out) : BS_OK;
}

/* Whether the forward product with its new centres turned is the product. */
static bs_status same_but_turned(bs_ctx *cx, const bs_case *kase, const bs_made *made,
                                 const bs_mol *product, const char *product_smiles,
                                 const uint32_t *where, bool *same, bool *open)
{
    bs_mark temp = bs_arena_mark(&cx->scratch);
    bs_made turned = *made;
    bs_mol *mol;
    char *smiles;
    bs_status st = turned_product(cx, kase, made, &mol);

    *same = *open = false;
    if (st == BS_OK && mol &&
        (st = bs_smiles_canonical(cx, &cx->scratch, mol, 0, &smiles)) == BS_OK) {
        turned.outcome.products = &mol;
        turned.outcome.smiles = &smiles;
        *same = strcmp(smiles, product_smiles) == 0;
        if (!*same) {
            st = same_but_stereo(cx, kase, &turned, product, product_smiles, where, open);
            *same = *open;
        }
    }
    bs_arena_rewind(&cx->scratch, temp);
    return st;
}

/* ---- Running
 * -------------------------------------------------------------------------------------- */

/* The next order of `count` numbers in the manner of a dictionary; false after the last. */
static bool next_order(int *order, int count)
{
    int i = count - 2, k = count - 1, swap;

    while (i >= 0 && order[i] >= order[i + 1])
        i--;
    if (i < 0)
        return false;
    while (order[k] <= order[i])
        k--;
    swap = order[i];
    order[i] = order[k];
    order[k] = swap;
    for (int a = i + 1, b = count - 1; a < b; a++, b--) {
        swap = order[a];
        order[a] = order[b];
        order[b] = swap;
    }
    return true;
}

/* Runs the case on the precursors in every order, as they would meet in one flask. */
static bs_status run_orders(bs_ctx *cx, bs_forward *run, const bs_case *kase, bs_mol *const *parts,
                            char *const *smiles)
{
    int count = kase->source.part_count;
    const bs_mol **mols;
    uint32_t *reactant;
    int *order;
    bs_status st;

    if ((st = bs_new(cx, &cx->scratch, count + 1, &mols)) != BS_OK ||
        (st = bs_new(cx, &cx->scratch, count + 1, &reactant)) != BS_OK ||
        (st = bs_new(cx, &cx->scratch, count + 1, &order)) != BS_OK)
        return st;
    /* Equal molecules share a number, so that their exchange is no new order. */
    for (int i = 0; i < count; i++) {
        order[i] = i;
        for (int k = i - 1; k >= 0; k--) {
            if (strcmp(smiles[i], smiles[k]) == 0)
                order[i] = order[k];
        }
    }
    do {
        for (int i = 0; i < count; i++) {
            mols[i] = parts[order[i]];
            reactant[i] = (uint32_t)order[i];
        }
        if ((st = bs_forward__run(cx, run, kase, mols, reactant)) != BS_OK)
            return st;
    } while (count <= MAX_PERMUTED && next_order(order, count));
    return BS_OK;
}

static bs_status find_product(bs_ctx *cx, const bs_forward *run, const bs_case *kase,
                              const bs_mol *product, const char *product_smiles,
                              const uint32_t *where, int *found, bool *open)
{
    bs_status st = BS_OK;

    *found = -1;
    *open = false;
    for (int i = 0; i < run->made.count && *found < 0; i++) {
        if (strcmp(run->made.items[i].outcome.smiles[0], product_smiles) == 0)
            *found = i;
    }
    for (int i = 0; i < run->made.count && *found < 0 && st == BS_OK; i++) {
        st = same_but_stereo(cx, kase, &run->made.items[i], product, product_smiles, where, open);
        if (*open)
            *found = i;
    }
    for (int i = 0; i < run->made.count && *found < 0 && st == BS_OK; i++) {
        bool same;

        st = same_but_turned(cx, kase, &run->made.items[i], product, product_smiles, where, &same,
                             open);
        if (same)
            *found = i;
    }
    return st;
}

static bs_status list_rivals(bs_ctx *cx, bs_arena *home, const bs_forward *run, int found,
                             bs_mol *const *parts, bool kinds, bs_outcomes *out)
{
    int part_count = run->kase->source.part_count;
    const bs_outcome *wanted = &run->made.items[found].outcome;
    bs_status st = bs_new(cx, home, run->made.count + 1, &out->items);

    for (int i = 0; i < run->made.count && st == BS_OK; i++) {
        bs_outcome *rival = &out->items[out->count];

        if (i == found)
            continue;
        *rival = run->made.items[i].outcome;
        out->count++;
        if (kinds)
            st = bs_rival__kind(cx, wanted, rival, (const bs_mol *const *)parts, part_count,
                                &rival->kind);
    }
    return st;
}

/* Whether the rule favours a rival, other than one of the precursors themselves. */
static bool is_minor(const bs_forward *run, int found, char *const *smiles, int part_count)
{
    for (int i = 0; i < run->made.count; i++) {
        const bs_made *made = &run->made.items[i];
        bool precursor = false;

        for (int p = 0; p < part_count; p++)
            precursor = precursor || strcmp(made->outcome.smiles[0], smiles[p]) == 0;
        if (!precursor && made->score > run->made.items[found].score + BS_SCORE_NOISE)
            return true;
    }
    return false;
}

bs_status bs_check__step(bs_ctx *cx, bs_arena *home, const bs_transform *tr, const bs_case *kase,
                         const bs_rule_hooks *hooks, unsigned flags, bs_mol *const *parts,
                         char *const *smiles, const bs_mol *product, const char *product_smiles,
                         const uint32_t *where, bs_verdict *out)
{
    bs_mark temp = bs_arena_mark(&cx->scratch);
    bs_forward run;
    int found = -1;
    bs_status st;

    *out = (bs_verdict){0};
    bs_forward__init(&run, cx, home, tr, hooks, false);
    st = run_orders(cx, &run, kase, parts, smiles);
    if (st == BS_OK)
        st =
            find_product(cx, &run, kase, product, product_smiles, where, &found, &out->stereo_open);
    out->passed = found >= 0;
    if (st == BS_OK && out->passed) {
        out->minor = is_minor(&run, found, smiles, kase->source.part_count);
        st = list_rivals(cx, home, &run, found, parts, flags & BS_BACK_KINDS, &out->rivals);
    }
    bs_forward__free(&run);
    bs_arena_rewind(&cx->scratch, temp);
    return st;
}
