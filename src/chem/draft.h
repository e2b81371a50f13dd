/* The inside of drafts: what draft.c, finish.c and their helpers share. */
#ifndef CHEM_DRAFT_H
#define CHEM_DRAFT_H

#include "backsaw/draft.h"
#include "chem/mol.h"

struct bs_rings;

/* Makes room in an empty draft, so that filling it does not grow the arrays step by step. */
bs_status bs_draft__reserve(bs_draft *draft, uint32_t atoms, uint32_t bonds);

/* An empty block with room for so many atoms, bonds, rings and atoms of rings. */
bs_status bs_mol__new(bs_ctx *cx, bs_arena *home, uint32_t atoms, uint32_t bonds, uint32_t rings,
                      uint32_t ring_atoms, bs_mol **out);

/* The stereo element of an atom or of a double bond, as a draft would say it; false for none. */
bool bs_stereo__of_atom(const bs_mol *mol, uint32_t atom, bs_draft_stereo *out);
bool bs_stereo__of_bond(const bs_mol *mol, uint32_t bond, bs_draft_stereo *out);

/*
 * Puts the stereo elements of a draft on the molecule, in the order of its neighbours, and drops
 * those that mean nothing. `order` leads from draft atoms to atoms; folded hydrogens and gone
 * atoms are UINT32_MAX there. Rings, aromaticity and hydrogens are known by then.
 */
bs_status bs_stereo__place(bs_ctx *cx, const bs_draft *draft, const uint32_t *order,
                           const struct bs_rings *rings, bs_mol *mol);

/*
 * Remembers on atoms and bonds the elements of a draft that were written on purpose and did not
 * stay. Elements of double bonds count only where the marks can belong to no other double bond, and
 * not in rings, where many programs write them.
 */
void bs_stereo__note_unmarked(const bs_draft *draft, const uint32_t *order, bs_mol *mol);

/*
 * Gives the bonds of order BS_DRAFT_ORDER_AROMATIC orders 1 and 2. `stated` has the hydrogens of
 * each atom or BS_DRAFT_IMPLIED, `wish` whether it was written as aromatic. On BS_EVALUE
 * error.offset is the atom.
 */
bs_status bs_kekule__assign(bs_ctx *cx, bs_mol *mol, const int16_t *stated, const bool *wish);

/*
 * Moves double bonds that lie inside of aromatic systems, but are not aromatic, to their rim where
 * that can be done, so that all Kekulé forms of one compound end as one.
 */
bs_status bs_kekule__settle(bs_ctx *cx, bs_mol *mol);

/* Sets the aromatic marks of atoms and bonds. */
bs_status bs_aromatic__mark(bs_ctx *cx, bs_mol *mol, const struct bs_rings *rings);

static inline bs_bond *bs_mol__bonds_mutable(bs_mol *mol)
{
    return (bs_bond *)((char *)mol + mol->bonds_at);
}

/*
 * bs_draft_finish() without the features that match asks for: for a molecule that is only cut into
 * its pieces (bs_mol_fragments() finds theirs).
 */
bs_status bs_draft__finish_plain(bs_draft *draft, bs_arena *home, uint32_t **order, bs_mol **out);

#endif
