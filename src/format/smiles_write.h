/*
 * The inside of the SMILES writer: a plan of the string is made first (which bonds close rings, in
 * which order atoms and neighbours come, which slants they bear), then the text.
 */
#ifndef FORMAT_SMILES_WRITE_H
#define FORMAT_SMILES_WRITE_H

#include "backsaw/format.h"
#include "chem/draft.h"

/*
 * `rank` is the preferred order of the atoms. The links of each atom stand in the order of the
 * string: the atom before, ring closures that end there, those that begin there, branches, the
 * atom behind.
 */
typedef struct smiles_plan {
    bs_ctx *cx;
    const bs_mol *mol;
    unsigned flags;
    const int *rank;
    bool tidy;        /* start at chain ends, short branches first, double bonds within the tree */
    uint32_t *order;  /* atoms as they are written */
    uint32_t *place;  /* by atom: where it stands in `order` */
    uint32_t *starts; /* by piece: where it starts in `order`; one more at the end */
    uint32_t piece_count;
    bs_link *links;    /* as those of the molecule, in written order */
    uint32_t *entry;   /* by atom: bond to the atom before, or UINT32_MAX */
    uint8_t *closings; /* by atom: ring closures that end there */
    uint8_t *openings; /* and that begin there */
    char *slants;      /* by bond: / or \ in written direction, or 0 */
    char *hydrogen;    /* by atom: slant of a hydrogen that has to be shown, or 0 */
} smiles_plan;

/* Plans the string in the scratch arena. */
bs_status smiles_plan_make(smiles_plan *plan);

/* Fills the slants of a plan whose order is made. */
bs_status smiles_plan_slants(smiles_plan *plan);

static inline const bs_link *smiles_plan_links(const smiles_plan *plan, uint32_t atom)
{
    const uint32_t *offsets = bs_mol__at(plan->mol, plan->mol->offsets_at);

    return plan->links + offsets[atom];
}

/*
 * Writes a planned molecule, the pieces in the order of their text if `sorted`, else as planned.
 * order[k] and at[k] as bs_smiles_canonical_order(); both may be NULL.
 */
bs_status smiles_write_plan(const smiles_plan *plan, bool sorted, bs_arena *home, char **out,
                            uint32_t **order, uint32_t **at);

#endif
