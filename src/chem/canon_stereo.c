/* Stereo elements for canonical order: their ligands, and their codes under a colouring. */
#include "chem/canon.h"

#include <string.h>

#include "chem/stereo.h"

/* A lone pair and an implied hydrogen come before all atoms. */
static inline uint32_t place_of(uint32_t ligand, const uint32_t *colour)
{
    return bs_canon__is_atom(ligand) ? colour[ligand] + 2 : ligand - BS_CANON_LONE_PAIR;
}

/* ---- Reading marks from a molecule ----------------------------------------------------- */

/* The next atom of a chain of double bonds, or BS_CANON_NONE where `atom` is its end. */
static uint32_t chain_next(const bs_mol *mol, uint32_t atom, uint32_t from)
{
    const bs_bond *bonds = bs_mol__bonds(mol);
    const bs_link *links = bs_mol__links(mol, atom);

    if (mol->atoms[atom].degree != 2 || mol->atoms[atom].hydrogens != 0)
        return BS_CANON_NONE;
    for (uint32_t k = 0; k < 2; k++)
        if (bonds[links[k].bond].order != 2 || bonds[links[k].bond].flags & BS_BOND_AROMATIC)
            return BS_CANON_NONE;
    return links[links[0].atom == from ? 1 : 0].atom;
}

/* Walks along double bonds to the end of a cumulene; *from gets the atom before it. */
static uint32_t chain_end(const bs_mol *mol, uint32_t atom, uint32_t *from)
{
    for (uint32_t steps = 0; steps < mol->atom_count; steps++) {
        uint32_t next = chain_next(mol, atom, *from);

        if (next == BS_CANON_NONE)
            break;
        *from = atom;
        atom = next;
    }
    return atom;
}

/*
 * The two ligands of a double bond's end, an implied one first; false if there are not two. The
 * end of an imine without substituent has a hydrogen and a lone pair.
 */
static bool end_ligands(const bs_mol *mol, uint32_t end, uint32_t from, uint32_t ligand[2])
{
    const bs_link *links = bs_mol__links(mol, end);
    uint32_t degree = mol->atoms[end].degree, count = 0;

    if (degree > 3 || degree + mol->atoms[end].hydrogens > 3)
        return false;
    if (degree == 1 && mol->atoms[end].hydrogens == 1) {
        ligand[count++] = BS_CANON_NONE;
        ligand[count++] = BS_CANON_LONE_PAIR;
    } else if (degree == 2) {
        ligand[count++] = BS_CANON_NONE;
    }
    for (uint32_t k = 0; k < degree; k++)
        if (links[k].atom != from && count < 2)
            ligand[count++] = links[k].atom;
    return count == 2;
}

bool bs_canon__atom_element(const bs_mol *mol, uint32_t atom, bs_canon_element *element)
{
    int count;

    memset(element, 0, sizeof *element);
    element->kind = mol->atoms[atom].stereo;
    element->source = atom;
    element->site_count = 1;
    element->site[0] = atom;
    if (element->kind == BS_STEREO_NONE)
        return false;
    count = bs_stereo__around(mol, atom, element->kind, element->ligand);
    element->ligand_count = (uint8_t)count;
    if (count > 0)
        element->perm = mol->atoms[atom].perm;
    return element->perm != 0;
}

bool bs_canon__bond_element(const bs_mol *mol, uint32_t bond, bs_canon_element *element)
{
    const bs_bond *b = &bs_mol__bonds(mol)[bond];
    uint32_t from[2] = {b->b, b->a}, end[2] = {b->a, b->b};

    memset(element, 0, sizeof *element);
    if (!(b->flags & (BS_BOND_CIS | BS_BOND_TRANS)))
        return false;
    element->kind = BS_CANON_DOUBLE;
    element->source = bond;
    element->ligand_count = 4;
    element->site_count = 2;
    for (uint32_t side = 0; side < 2; side++) {
        end[side] = chain_end(mol, end[side], &from[side]);
        element->site[side] = end[side];
        if (!end_ligands(mol, end[side], from[side], element->ligand + 2 * side))
            return false;
    }
    /* The mark speaks of the first neighbours that are atoms; the element of the first ligands. */
    element->perm = b->flags & BS_BOND_CIS ? 1 : 2;
    for (uint32_t side = 0; side < 2; side++)
        if (!bs_canon__is_atom(element->ligand[2 * side]) &&
            bs_canon__is_atom(element->ligand[2 * side + 1]))
            element->perm ^= 3;
    return true;
}

/* ---- Codes ----------------------------------------------------------------------------- */

/* Puts the places of the ligands in `place`; false if two are the same. */
static bool distinct_places(const bs_canon_element *element, const uint32_t *colour,
                            uint32_t place[6])
{
    for (uint32_t k = 0; k < element->ligand_count; k++) {
        place[k] = place_of(element->ligand[k], colour);
        for (uint32_t i = 0; i < k; i++)
            if (place[i] == place[k])
                return false;
    }
    return true;
}

/* Whether sorting four ligands by place is an odd permutation. */
static bool is_odd(const uint32_t place[4])
{
    bool odd = false;

    for (uint32_t k = 1; k < 4; k++)
        for (uint32_t i = 0; i < k; i++)
            odd ^= place[i] > place[k];
    return odd;
}

/* The mark of a square, bipyramid or octahedron if its ligands were listed by place. */
static uint32_t polyhedron_code(const bs_canon_element *element, const uint32_t place[6])
{
    uint32_t sorted[6];

    memcpy(sorted, place, sizeof sorted);
    bs_canon__sort(sorted, element->ligand_count, NULL);
    return (uint32_t)bs_stereo__permute(element->kind, element->perm, element->ligand_count, place,
                                        sorted);
}

uint32_t bs_canon__code(const bs_canon_element *element, const uint32_t *colour)
{
    uint32_t place[6];
    bool turned;

    if (element->kind == BS_STEREO_ALLENE || element->kind == BS_CANON_DOUBLE) {
        /* Exchanging the two ends is an even permutation, so ligands of one end may be alike. */
        for (uint32_t k = 0; k < 4; k++)
            place[k] = place_of(element->ligand[k], colour);
        if (place[0] == place[1] || place[2] == place[3])
            return 0;
        turned = (place[0] > place[1]) ^ (place[2] > place[3]);
        return turned ? element->perm ^ 3u : element->perm;
    }
    if (!distinct_places(element, colour, place))
        return 0;
    if (element->kind == BS_STEREO_TETRAHEDRAL)
        return is_odd(place) ? element->perm ^ 3u : element->perm;
    return polyhedron_code(element, place);
}

bool bs_canon__add_code(const bs_canon_element *element, const uint32_t *colour, uint64_t *sum)
{
    uint32_t code = element->perm == 0 ? 0 : bs_canon__code(element, colour);

    if (code == 0)
        return false;
    for (uint32_t s = 0; s < element->site_count; s++)
        sum[element->site[s]] += (uint64_t)code << 8 * (element->kind - 1);
    return true;
}
