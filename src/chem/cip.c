/*
 * CIP labels of atoms and double bonds.
 *
 * Most are settled by rules 1 and 2 on a digraph that grows only as far as needed. For the others
 * the digraph is completed, each stereo element in it gets its auxiliary descriptor, those in the
 * farthest sphere first, and all rules are applied.
 */
#include "chem/cip.h"
#include "chem/stereo.h"

/* ---- From rankings to descriptors --------------------------------------------------------------- */

/* The descriptor of a tetrahedral centre; a lone pair is the last of four. */
static bs_cip_label name_centre(const bs_cip *cip, uint32_t node, const bs_cip_ranking *ranking)
{
    uint32_t atom = cip->nodes[node].atom;
    uint32_t around[6];
    uint32_t ranked[4];
    int count = bs_stereo__around(cip->mol, atom, BS_STEREO_TETRAHEDRAL, around);
    int perm;

    if (!ranking->distinct || count != 4 || ranking->count < 3 || ranking->count > 4)
        return BS_CIP_UNKNOWN;
    for (int k = 0; k < ranking->count; k++)
        ranked[k] = cip->nodes[ranking->legs[k]].atom;
    if (ranking->count == 3)
        ranked[3] = BS_DRAFT_HYDROGEN;
    perm = bs_stereo__permute(BS_STEREO_TETRAHEDRAL, cip->mol->atoms[atom].perm, 4, around, ranked);
    if (perm == 0)
        return BS_CIP_UNKNOWN;
    if (ranking->mirrored)
        return perm == 2 ? BS_CIP_SMALL_R : BS_CIP_SMALL_S;
    return perm == 2 ? BS_CIP_R : BS_CIP_S;
}

/* The descriptor of a double bond from the best ligands of its ends. */
static bs_cip_label name_double(const bs_draft_stereo *element, const uint32_t best[2],
                                bool mirrored)
{
    bool cis = element->perm == 1;

    for (int k = 0; k < 2; k++)
        cis ^= best[k] != element->around[k];
    if (mirrored)
        return cis ? BS_CIP_CIS : BS_CIP_TRANS;
    return cis ? BS_CIP_Z : BS_CIP_E;
}

/* ---- Auxiliary descriptors ---------------------------------------------------------------------- */

/* Names a centre inside of the digraph. */
static bs_status name_inner_centre(bs_cip *cip, uint32_t node)
{
    bs_cip_ranking ranking;
    bs_status st = bs_cip__rank(cip, node, BS_CIP_NONE, &ranking);

    if (st == BS_OK)
        cip->nodes[node].pending = (uint8_t)name_centre(cip, node, &ranking);
    return st;
}

/* Names the double bond between a node inside of the digraph and its child. */
static bs_status name_inner_double(bs_cip *cip, uint32_t node, uint32_t child,
                                   const bs_draft_stereo *element)
{
    uint32_t ends[2] = {node, child};
    uint32_t best[2];
    bool mirrored = false;
    bool turned = element->centre != cip->nodes[node].atom;
    bs_status st;

    for (int k = 0; k < 2; k++) {
        bs_cip_ranking ranking;

        if ((st = bs_cip__rank(cip, ends[k], ends[1 - k], &ranking)) != BS_OK)
            return st;
        if (!ranking.distinct || ranking.count < 1)
            return BS_OK;
        best[turned ? 1 - k : k] = cip->nodes[ranking.legs[0]].atom;
        mirrored ^= ranking.mirrored;
    }
    cip->nodes[node].pending = (uint8_t)name_double(element, best, mirrored);
    return BS_OK;
}

/* Names what a node stands for: a centre, or the first double bond to a child that has a geometry. */
static bs_status name_inner(bs_cip *cip, uint32_t at)
{
    const bs_cip_node *node = &cip->nodes[at];
    bs_draft_stereo element;

    if (node->kind != BS_CIP_REAL || node->atom == BS_DRAFT_HYDROGEN)
        return BS_OK;
    if (cip->mol->atoms[node->atom].stereo == BS_STEREO_TETRAHEDRAL)
        return name_inner_centre(cip, at);
    for (uint32_t child = node->first; child < node->first + node->count; child++) {
        int bond;

        if (cip->nodes[child].kind != BS_CIP_REAL || cip->nodes[child].atom == BS_DRAFT_HYDROGEN)
            continue;
        bond = bs_mol_bond_between(cip->mol, (int)node->atom, (int)cip->nodes[child].atom);
        if (bs_stereo__of_bond(cip->mol, (uint32_t)bond, &element) &&
            (element.centre == node->atom || element.second == node->atom))
            return name_inner_double(cip, at, child, &element);
    }
    return BS_OK;
}

/* Descriptors come into force sphere by sphere, so that equals are named on equal knowledge. */
static bs_status name_all(bs_cip *cip)
{
    uint32_t end = cip->count;
    bs_status st;

    for (uint32_t at = cip->count; at-- > 1;) {
        if ((st = name_inner(cip, at)) != BS_OK)
            return st;
        if (cip->nodes[at - 1].depth == cip->nodes[at].depth)
            continue;
        for (; end > at; end--)
            cip->nodes[end - 1].aux = cip->nodes[end - 1].pending;
    }
    return BS_OK;
}

/* ---- Labels ------------------------------------------------------------------------------------- */

/* Ranks the ligands of an atom, but for the neighbour `skip`, with as few rules as are needed. */
static bs_status rank_ligands(bs_cip *cip, uint32_t atom, uint32_t skip, bs_cip_ranking *out)
{
    uint32_t child = BS_CIP_NONE;
    bool complete;
    bs_status st;

    if ((st = bs_cip__root(cip, atom)) != BS_OK ||
        (st = bs_cip__rank_lazily(cip, skip, out)) != BS_OK || out->distinct)
        return st;
    if ((st = bs_cip__grow(cip, UINT32_MAX, &complete)) != BS_OK || (st = name_all(cip)) != BS_OK)
        return st;
    for (uint32_t k = 0; k < cip->nodes[0].count; k++) {
        const bs_cip_node *node = &cip->nodes[cip->nodes[0].first + k];

        if (node->kind == BS_CIP_REAL && node->atom == skip && skip != BS_CIP_NONE)
            child = cip->nodes[0].first + k;
    }
    return bs_cip__rank(cip, 0, child, out);
}

static bs_status label_atom(bs_cip *cip, uint32_t atom, char *label)
{
    static const char letters[] = {0, 'R', 'S', 'r', 's'};
    bs_cip_ranking ranking;
    bs_status st = rank_ligands(cip, atom, BS_CIP_NONE, &ranking);

    if (st == BS_OK)
        *label = letters[name_centre(cip, 0, &ranking)];
    return st;
}

/* The neighbour of an end of a double bond, or of a chain of them, that is no ligand. */
static uint32_t inner_neighbour(const bs_mol *mol, uint32_t end)
{
    const bs_link *links = bs_mol__links(mol, end);

    for (int k = 0; k < mol->atoms[end].degree; k++)
        if (bs_mol__bonds(mol)[links[k].bond].order == 2)
            return links[k].atom;
    return BS_CIP_NONE;
}

static bs_status label_bond(bs_cip *cip, const bs_draft_stereo *element, char *label)
{
    uint32_t ends[2] = {element->centre, element->second};
    uint32_t best[2];
    bs_cip_label name;

    for (int k = 0; k < 2; k++) {
        bs_cip_ranking ranking;
        bs_status st = rank_ligands(cip, ends[k], inner_neighbour(cip->mol, ends[k]), &ranking);

        if (st != BS_OK)
            return st;
        if (!ranking.distinct || ranking.count < 1)
            return BS_OK;
        best[k] = cip->nodes[ranking.legs[0]].atom;
    }
    name = name_double(element, best, false);
    *label = name == BS_CIP_Z ? 'Z' : 'E';
    return BS_OK;
}

static bs_status label_all(bs_cip *cip, char *atoms, char *bonds)
{
    const bs_mol *mol = cip->mol;
    bs_draft_stereo element;
    bs_status st = BS_OK;

    for (uint32_t i = 0; i < mol->atom_count && st == BS_OK; i++)
        if (mol->atoms[i].stereo == BS_STEREO_TETRAHEDRAL)
            st = label_atom(cip, i, &atoms[i]);
    for (uint32_t i = 0; i < mol->bond_count && st == BS_OK; i++)
        if (bs_stereo__of_bond(mol, i, &element))
            st = label_bond(cip, &element, &bonds[i]);
    return st;
}

static bool has_stereo(const bs_mol *mol)
{
    bool found = false;

    for (uint32_t i = 0; i < mol->atom_count && !found; i++)
        found = mol->atoms[i].stereo == BS_STEREO_TETRAHEDRAL;
    for (uint32_t i = 0; i < mol->bond_count && !found; i++)
        found = bs_mol__bonds(mol)[i].flags & (BS_BOND_CIS | BS_BOND_TRANS);
    return found;
}

bs_status bs_mol_cip(bs_ctx *cx, bs_arena *home, const bs_mol *mol, char **atom_labels,
                     char **bond_labels)
{
    bs_mark kept = bs_arena_mark(home);
    bs_cip cip;
    bs_status st;

    if ((st = bs_new(cx, home, mol->atom_count + 1, atom_labels)) != BS_OK ||
        (st = bs_new(cx, home, mol->bond_count + 1, bond_labels)) != BS_OK)
        goto done;
    if (!has_stereo(mol))
        return BS_OK;
    if ((st = bs_cip__open(cx, mol, &cip)) == BS_OK)
        st = label_all(&cip, *atom_labels, *bond_labels);
    bs_cip__close(&cip);
done:
    if (st != BS_OK) {
        bs_arena_rewind(home, kept);
        *atom_labels = NULL;
        *bond_labels = NULL;
    }
    return st;
}
