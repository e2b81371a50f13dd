/* Putting a draft together; finish.c makes the molecule. */
#include "chem/draft.h"

#include <string.h>

void bs_draft_init(bs_draft *draft, bs_ctx *cx, bs_arena *home)
{
    memset(draft, 0, sizeof *draft);
    draft->cx = cx;
    draft->home = home;
}

/* Makes room for one more element of a growing array in the draft's arena. */
static bs_status grow(bs_draft *draft, void *array, uint32_t count, uint32_t *room, size_t size)
{
    uint32_t wanted = *room ? *room * 2 : 32;
    void *old;
    void *block;

    if (count < *room)
        return BS_OK;
    block = bs_arena_alloc(draft->home, wanted * size);
    if (!block)
        return bs_fail_memory(draft->cx);
    memcpy(&old, array, sizeof old);
    if (count > 0)
        memcpy(block, old, count * size);
    memcpy(array, &block, sizeof block);
    *room = wanted;
    return BS_OK;
}

bs_status bs_draft__reserve(bs_draft *draft, uint32_t atoms, uint32_t bonds)
{
    bs_status st;

    if (draft->atom_room > 0 || draft->bond_room > 0)
        return BS_OK;
    if ((st = bs_new(draft->cx, draft->home, atoms, &draft->atoms)) != BS_OK ||
        (st = bs_new(draft->cx, draft->home, bonds, &draft->bonds)) != BS_OK)
        return st;
    draft->atom_room = atoms;
    draft->bond_room = bonds;
    return BS_OK;
}

bs_status bs_draft_add_atom(bs_draft *draft, bs_draft_atom atom, uint32_t *index)
{
    bs_status st;

    if (draft->atom_count >= BS_MOL_MAX_ATOMS)
        return bs_fail(draft->cx, BS_ELIMIT, "a molecule has at most %d atoms", BS_MOL_MAX_ATOMS);
    st = grow(draft, &draft->atoms, draft->atom_count, &draft->atom_room, sizeof *draft->atoms);
    if (st != BS_OK)
        return st;
    if (index)
        *index = draft->atom_count;
    draft->atoms[draft->atom_count++] = atom;
    return BS_OK;
}

bs_status bs_draft_add_bond(bs_draft *draft, uint32_t a, uint32_t b, int order, uint32_t *index)
{
    bs_status st;

    if (draft->bond_count >= 4u * BS_MOL_MAX_ATOMS)
        return bs_fail(draft->cx, BS_ELIMIT, "a molecule has at most %d bonds",
                       4 * BS_MOL_MAX_ATOMS);
    st = grow(draft, &draft->bonds, draft->bond_count, &draft->bond_room, sizeof *draft->bonds);
    if (st != BS_OK)
        return st;
    if (index)
        *index = draft->bond_count;
    draft->bonds[draft->bond_count++] = (bs_draft_bond){a, b, (uint8_t)order, false};
    return BS_OK;
}

bs_status bs_draft_add_stereo(bs_draft *draft, bs_draft_stereo element)
{
    bs_status st = grow(draft, &draft->stereo, draft->stereo_count, &draft->stereo_room,
                        sizeof *draft->stereo);

    if (st == BS_OK)
        draft->stereo[draft->stereo_count++] = element;
    return st;
}

static bs_status take_atoms(bs_draft *draft, const bs_mol *mol)
{
    bs_status st = BS_OK;

    for (uint32_t i = 0; i < mol->atom_count && st == BS_OK; i++) {
        const bs_atom *a = &mol->atoms[i];

        st = bs_draft_add_atom(draft,
                               (bs_draft_atom){.element = a->element,
                                               .charge = a->charge,
                                               .hydrogens = a->hydrogens,
                                               .isotope = a->isotope,
                                               .label = a->label},
                               NULL);
    }
    return st;
}

bs_status bs_draft_from_mol(bs_draft *draft, const bs_mol *mol)
{
    const bs_bond *bonds = bs_mol__bonds(mol);
    bs_status st = bs_draft__reserve(draft, mol->atom_count + 8, mol->bond_count + 8);

    if (st == BS_OK)
        st = take_atoms(draft, mol);
    for (uint32_t i = 0; i < mol->bond_count && st == BS_OK; i++)
        st = bs_draft_add_bond(draft, bonds[i].a, bonds[i].b, (int)bonds[i].order, NULL);
    for (uint32_t i = 0; i < mol->atom_count && st == BS_OK; i++) {
        bs_draft_stereo element;

        if (bs_stereo__of_atom(mol, i, &element))
            st = bs_draft_add_stereo(draft, element);
    }
    for (uint32_t i = 0; i < mol->bond_count && st == BS_OK; i++) {
        bs_draft_stereo element;

        if (bs_stereo__of_bond(mol, i, &element))
            st = bs_draft_add_stereo(draft, element);
    }
    return st;
}
