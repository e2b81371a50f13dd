/* Hybridisation: neighbours and lone pairs (VSEPR), less one where a lone pair is conjugated. */
#include "chem/hybrid.h"
#include "backsaw/descriptor.h"

typedef struct parts {
    const bs_atom *atoms;
    const bs_bond *bonds;
    const uint32_t *offsets;
    const bs_link *links;
} parts;

/* Electrons in the outer shell of a main-group element, 0 for others. */
static int outer_electrons(int element)
{
    static const uint8_t noble[] = {2, 10, 18, 36, 54, 86, 118};
    int below = 0;

    if (element <= 2)
        return element;
    for (int i = 0; noble[i] < element; i++)
        below = noble[i];
    element -= below;
    /* Below argon each row has ten, then fourteen more elements between its blocks. */
    if (below >= 54 && element > 2 + 24)
        return element - 24;
    if (below >= 18 && below < 54 && element > 2 + 10)
        return element - 10;
    return element <= 2 || below < 18 ? element : 0;
}

/* Whether a lone pair of the atom lies beside a double, triple or aromatic bond. */
static bool is_conjugated(const parts *s, uint32_t atom)
{
    const bs_link *links = s->links + s->offsets[atom];

    for (int k = 0; k < s->atoms[atom].degree; k++) {
        uint32_t other = links[k].atom;
        const bs_link *more = s->links + s->offsets[other];

        if (s->atoms[other].element > 9 && !(s->atoms[other].flags & BS_ATOM_AROMATIC))
            continue;
        for (int j = 0; j < s->atoms[other].degree; j++) {
            const bs_bond *bond = &s->bonds[more[j].bond];

            if (more[j].atom != atom && (bond->order > 1 || bond->flags & BS_BOND_AROMATIC))
                return true;
        }
    }
    return false;
}

int bs_hybrid__of(const bs_atom *atoms, const bs_bond *bonds, const uint32_t *offsets,
                  const bs_link *links, uint32_t atom, int connections)
{
    const parts s = {atoms, bonds, offsets, links};
    const bs_atom *a = &atoms[atom];
    int outer = outer_electrons(a->element);
    int pairs = outer > 0 ? (outer - a->charge - a->valence) / 2 : 0;
    int steric = connections + (pairs > 0 ? pairs : 0);

    if (a->flags & BS_ATOM_AROMATIC)
        return 2;
    if (connections == 0 || steric < 2)
        return 0;
    /* A lone pair that is conjugated is none that takes room. */
    if (steric == 4 && pairs > 0 && a->element >= 7 && a->element <= 8 && is_conjugated(&s, atom))
        steric = 3;
    return steric - 1 > 5 ? 5 : steric - 1;
}

int bs_mol_atom_hybridisation(const bs_mol *mol, int atom)
{
    const bs_atom *a = &mol->atoms[atom];

    return bs_hybrid__of(mol->atoms, bs_mol__bonds(mol), bs_mol__at(mol, mol->offsets_at),
                         bs_mol__at(mol, mol->links_at), (uint32_t)atom, a->degree + a->hydrogens);
}
