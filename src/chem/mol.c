/* The block of a molecule, and reading it. */
#include "chem/draft.h"

#include <string.h>

static void lay_out(bs_mol *mol, uint32_t atoms, uint32_t bonds, uint32_t rings,
                    uint32_t ring_atoms)
{
    uint32_t at = (uint32_t)(sizeof(bs_mol) + (size_t)atoms * sizeof(bs_atom));

    mol->atom_count = atoms;
    mol->bond_count = bonds;
    mol->ring_count = rings;
    mol->bonds_at = at;
    at += bonds * (uint32_t)sizeof(bs_bond);
    mol->links_at = at;
    at += 2 * bonds * (uint32_t)sizeof(bs_link);
    mol->offsets_at = at;
    at += (atoms + 1) * (uint32_t)sizeof(uint32_t);
    mol->rings_at = at;
    at += (rings + 1) * (uint32_t)sizeof(uint32_t);
    mol->ring_atoms_at = at;
    at += ring_atoms * (uint32_t)sizeof(uint32_t);
    mol->bytes = at;
}

bs_status bs_mol__new(bs_ctx *cx, bs_arena *home, uint32_t atoms, uint32_t bonds, uint32_t rings,
                      uint32_t ring_atoms, bs_mol **out)
{
    uint64_t bytes = sizeof(bs_mol) + (uint64_t)atoms * (sizeof(bs_atom) + 4) +
                     (uint64_t)bonds * (sizeof(bs_bond) + 2 * sizeof(bs_link)) +
                     ((uint64_t)rings + ring_atoms + 2) * 4;
    char *block;
    bs_status st;

    if (bytes > UINT32_MAX)
        return bs_fail(cx, BS_ELIMIT, "a molecule of %lu atoms and %lu bonds is too large",
                       (unsigned long)atoms, (unsigned long)bonds);
    if ((st = bs_new(cx, home, bytes, &block)) != BS_OK)
        return st;
    *out = (bs_mol *)(void *)block;
    lay_out(*out, atoms, bonds, rings, ring_atoms);
    return BS_OK;
}

size_t bs_mol_bytes(const bs_mol *mol)
{
    return mol->bytes;
}

int bs_mol_atom_count(const bs_mol *mol)
{
    return (int)mol->atom_count;
}

int bs_mol_bond_count(const bs_mol *mol)
{
    return (int)mol->bond_count;
}

int bs_mol_charge(const bs_mol *mol)
{
    return mol->charge;
}

bs_status bs_mol_copy(bs_ctx *cx, bs_arena *home, const bs_mol *mol, bs_mol **out)
{
    void *block = bs_arena_alloc(home, mol->bytes);

    *out = block;
    if (!block)
        return bs_fail_memory(cx);
    memcpy(block, mol, mol->bytes);
    return BS_OK;
}

int bs_mol_atom_element(const bs_mol *mol, int atom)
{
    return mol->atoms[atom].element;
}

int bs_mol_atom_charge(const bs_mol *mol, int atom)
{
    return mol->atoms[atom].charge;
}

int bs_mol__total_hydrogens(const bs_mol *mol, uint32_t atom)
{
    const bs_link *links = bs_mol__links(mol, atom);
    int hydrogens = mol->atoms[atom].hydrogens;

    for (int k = 0; k < mol->atoms[atom].degree; k++)
        hydrogens += mol->atoms[links[k].atom].element == 1;
    return hydrogens;
}

int bs_mol_atom_hydrogens(const bs_mol *mol, int atom)
{
    return bs_mol__total_hydrogens(mol, (uint32_t)atom);
}

int bs_mol_atom_isotope(const bs_mol *mol, int atom)
{
    return mol->atoms[atom].isotope;
}

int bs_mol_atom_label(const bs_mol *mol, int atom)
{
    return mol->atoms[atom].label;
}

bool bs_mol_atom_is_aromatic(const bs_mol *mol, int atom)
{
    return mol->atoms[atom].flags & BS_ATOM_AROMATIC;
}

bool bs_mol_atom_in_ring(const bs_mol *mol, int atom)
{
    return mol->atoms[atom].flags & BS_ATOM_RING;
}

int bs_mol_atom_degree(const bs_mol *mol, int atom)
{
    return mol->atoms[atom].degree;
}

int bs_mol_atom_carbons(const bs_mol *mol, int atom)
{
    const bs_link *links = bs_mol__links(mol, (uint32_t)atom);
    int carbons = 0;

    for (int k = 0; k < mol->atoms[atom].degree; k++)
        carbons += mol->atoms[links[k].atom].element == 6;
    return carbons;
}

void bs_mol_neighbour(const bs_mol *mol, int atom, int k, int *neighbour, int *bond)
{
    const bs_link *link = bs_mol__links(mol, (uint32_t)atom) + k;

    if (neighbour)
        *neighbour = (int)link->atom;
    if (bond)
        *bond = (int)link->bond;
}

bs_hand bs_mol_atom_hand(const bs_mol *mol, int atom)
{
    const bs_atom *a = &mol->atoms[atom];

    if (a->stereo != BS_STEREO_TETRAHEDRAL)
        return BS_HAND_NONE;
    return a->perm == 1 ? BS_HAND_ANTICLOCKWISE : BS_HAND_CLOCKWISE;
}

void bs_mol_bond_ends(const bs_mol *mol, int bond, int *a, int *b)
{
    const bs_bond *line = bs_mol__bonds(mol) + bond;

    *a = (int)line->a;
    *b = (int)line->b;
}

int bs_mol_bond_between(const bs_mol *mol, int a, int b)
{
    const bs_link *links;

    if (mol->atoms[b].degree < mol->atoms[a].degree) {
        int swap = a;

        a = b;
        b = swap;
    }
    links = bs_mol__links(mol, (uint32_t)a);
    for (int k = 0; k < mol->atoms[a].degree; k++) {
        if (links[k].atom == (uint32_t)b)
            return (int)links[k].bond;
    }
    return -1;
}

int bs_mol_bond_order(const bs_mol *mol, int bond)
{
    return (int)bs_mol__bonds(mol)[bond].order;
}

bool bs_mol_bond_is_aromatic(const bs_mol *mol, int bond)
{
    return bs_mol__bonds(mol)[bond].flags & BS_BOND_AROMATIC;
}

bool bs_mol_bond_in_ring(const bs_mol *mol, int bond)
{
    return bs_mol__bonds(mol)[bond].flags & BS_BOND_RING;
}

bs_geometry bs_mol_bond_geometry(const bs_mol *mol, int bond)
{
    unsigned flags = bs_mol__bonds(mol)[bond].flags;

    if (flags & BS_BOND_CIS)
        return BS_GEOMETRY_CIS;
    return flags & BS_BOND_TRANS ? BS_GEOMETRY_TRANS : BS_GEOMETRY_NONE;
}

int bs_mol_ring_count(const bs_mol *mol)
{
    return (int)mol->ring_count;
}

int bs_mol_ring(const bs_mol *mol, int ring, const uint32_t **atoms)
{
    const uint32_t *offsets = bs_mol__at(mol, mol->rings_at);
    const uint32_t *all = bs_mol__at(mol, mol->ring_atoms_at);

    if (atoms)
        *atoms = all + offsets[ring];
    return (int)(offsets[ring + 1] - offsets[ring]);
}
