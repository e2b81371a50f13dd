/*
 * InChI and InChIKey through libinchi (version 1.03), with stereo given as parities without
 * coordinates.
 */
#include "backsaw/format.h"

#include <inchi_api.h>
#include <pthread.h>
#include <stdio.h>
#include <string.h>

#include "backsaw/draft.h"
#include "chem/mol.h"

enum {
    MAX_ATOMS = 1023, /* limit of the library */
    MAX_NEIGHBOURS = MAXVAL
};

/*
 * The one piece of mutable static state in backsaw: libinchi keeps its own state in static
 * variables and answers BUSY to a second caller, so whoever calls it has to hold a lock that all
 * contexts of the process share.
 */
static pthread_mutex_t library_lock = PTHREAD_MUTEX_INITIALIZER;

/* ---- Atoms ----------------------------------------------------------------------------- */

static bs_status fill_bonds(bs_ctx *cx, const bs_mol *mol, uint32_t atom, inchi_Atom *out)
{
    const bs_bond *bonds = bs_mol__bonds(mol);
    const bs_link *links = bs_mol__links(mol, atom);

    for (uint32_t k = 0; k < mol->atoms[atom].degree; k++) {
        unsigned order = bonds[links[k].bond].order;

        /* The library wants each bond once, and knows no bond without an order. */
        if (links[k].atom > atom || order == 0)
            continue;
        if (order > 3)
            return bs_fail(cx, BS_EVALUE, "InChI knows no quadruple bond (atom %u)", atom + 1);
        if (out->num_bonds == MAX_NEIGHBOURS)
            return bs_fail(cx, BS_ELIMIT, "InChI takes at most %d neighbours (atom %u)",
                           MAX_NEIGHBOURS, atom + 1);
        out->neighbor[out->num_bonds] = (AT_NUM)links[k].atom;
        out->bond_type[out->num_bonds] = (S_CHAR)order;
        out->num_bonds++;
    }
    return BS_OK;
}

static bs_status fill_atom(bs_ctx *cx, const bs_mol *mol, uint32_t atom, inchi_Atom *out)
{
    const bs_atom *from = &mol->atoms[atom];

    if (from->element == 0)
        return bs_fail(cx, BS_EVALUE, "InChI knows no unknown atom (atom %u is *)", atom + 1);
    if (from->hydrogens > INT8_MAX)
        return bs_fail(cx, BS_ELIMIT, "too many hydrogens for InChI (atom %u)", atom + 1);
    snprintf(out->elname, sizeof out->elname, "%s", bs_element_symbol(from->element));
    out->num_iso_H[0] = (S_CHAR)from->hydrogens;
    out->isotopic_mass = (AT_NUM)from->isotope;
    out->charge = from->charge;
    return fill_bonds(cx, mol, atom, out);
}

/* ---- Stereo ---------------------------------------------------------------------------- */

/* The first neighbour of a double bond's end that is not on the chain of double bonds. */
static uint32_t side_atom(const bs_mol *mol, uint32_t end)
{
    const bs_bond *bonds = bs_mol__bonds(mol);
    const bs_link *links = bs_mol__links(mol, end);

    for (uint32_t k = 0; k < mol->atoms[end].degree; k++)
        if (bonds[links[k].bond].order != 2)
            return links[k].atom;
    return BS_DRAFT_HYDROGEN;
}

/* Of the two ligands of an end one that is an atom; *turned changes if it is not the first. */
static uint32_t atom_ligand(const uint32_t ligand[2], bool *turned)
{
    if (ligand[0] != BS_DRAFT_HYDROGEN)
        return ligand[0];
    *turned = !*turned;
    return ligand[1];
}

/*
 * The centre stands for an implied hydrogen and comes first, as the library wants it. Seen from
 * the first, clockwise is even.
 */
static bool fill_centre(const bs_draft_stereo *from, inchi_Stereo0D *out)
{
    uint32_t around[4];
    bool clockwise = from->perm == 2;

    memcpy(around, from->around, sizeof around);
    for (uint32_t k = 1; k < 4; k++) {
        if (around[k] != BS_DRAFT_HYDROGEN)
            continue;
        around[k] = around[0];
        around[0] = BS_DRAFT_HYDROGEN;
        clockwise = !clockwise;
    }
    for (uint32_t k = 0; k < 4; k++)
        out->neighbor[k] =
            (AT_NUM)(around[k] == BS_DRAFT_HYDROGEN ? from->centre : around[k]);
    out->central_atom = (AT_NUM)from->centre;
    out->type = INCHI_StereoType_Tetrahedral;
    out->parity = clockwise ? INCHI_PARITY_EVEN : INCHI_PARITY_ODD;
    return true;
}

static bool fill_double(const bs_mol *mol, const bs_draft_stereo *from, inchi_Stereo0D *out)
{
    uint32_t end[2] = {from->centre, from->second}, beside[2];
    bool turned = false;

    for (uint32_t side = 0; side < 2; side++) {
        uint32_t ligand[2] = {from->around[side], side_atom(mol, end[side])};

        beside[side] = atom_ligand(ligand, &turned);
        if (beside[side] == BS_DRAFT_HYDROGEN)
            return false;
    }
    out->neighbor[0] = (AT_NUM)beside[0];
    out->neighbor[1] = (AT_NUM)end[0];
    out->neighbor[2] = (AT_NUM)end[1];
    out->neighbor[3] = (AT_NUM)beside[1];
    out->central_atom = NO_ATOM;
    out->type = INCHI_StereoType_DoubleBond;
    out->parity = (from->perm == 1) ^ turned ? INCHI_PARITY_ODD : INCHI_PARITY_EVEN;
    return true;
}

/*
 * The ligands of an allene are listed as two on one end, two on the other; seen from the first,
 * the other three run anticlockwise if perm is 1. With X and A on one end and B and Y on the
 * other, the library calls this even for X before its fellow and Y before its own.
 */
static bool fill_allene(const bs_mol *mol, const bs_draft_stereo *from, inchi_Stereo0D *out)
{
    const bs_link *links = bs_mol__links(mol, from->centre);
    uint32_t beside[2];
    bool turned = false;

    for (uint32_t side = 0; side < 2; side++) {
        beside[side] = atom_ligand(from->around + 2 * side, &turned);
        if (beside[side] == BS_DRAFT_HYDROGEN ||
            bs_mol_bond_between(mol, (int)beside[side], (int)links[side].atom) < 0)
            return false;
    }
    out->neighbor[0] = (AT_NUM)beside[0];
    out->neighbor[1] = (AT_NUM)links[0].atom;
    out->neighbor[2] = (AT_NUM)links[1].atom;
    out->neighbor[3] = (AT_NUM)beside[1];
    out->central_atom = (AT_NUM)from->centre;
    out->type = INCHI_StereoType_Allene;
    out->parity = (from->perm == 1) ^ turned ? INCHI_PARITY_EVEN : INCHI_PARITY_ODD;
    return true;
}

/* Translates one stereo element; false for kinds that InChI does not know. */
static bool fill_stereo(const bs_mol *mol, const bs_draft_stereo *from, inchi_Stereo0D *out)
{
    switch (from->kind) {
    case BS_STEREO_TETRAHEDRAL:
        return fill_centre(from, out);
    case BS_STEREO_ALLENE:
        return fill_allene(mol, from, out);
    case BS_DRAFT_DOUBLE:
        return fill_double(mol, from, out);
    default:
        return false;
    }
}

/* ---- The call -------------------------------------------------------------------------- */

/* Fills the library's input; its arrays are in the scratch arena. */
static bs_status fill_input(bs_ctx *cx, const bs_mol *mol, inchi_Input *input)
{
    bs_draft draft;
    bs_status st;

    if (mol->atom_count > MAX_ATOMS)
        return bs_fail(cx, BS_ELIMIT, "InChI takes at most %d atoms; the molecule has %u",
                       MAX_ATOMS, mol->atom_count);
    bs_draft_init(&draft, cx, &cx->scratch);
    if ((st = bs_draft_from_mol(&draft, mol)) != BS_OK ||
        (st = bs_new(cx, &cx->scratch, mol->atom_count, &input->atom)) != BS_OK ||
        (st = bs_new(cx, &cx->scratch, draft.stereo_count, &input->stereo0D)) != BS_OK)
        return st;
    input->num_atoms = (AT_NUM)mol->atom_count;
    for (uint32_t i = 0; i < mol->atom_count; i++)
        if ((st = fill_atom(cx, mol, i, &input->atom[i])) != BS_OK)
            return st;
    for (uint32_t i = 0; i < draft.stereo_count; i++)
        if (fill_stereo(mol, &draft.stereo[i], &input->stereo0D[input->num_stereo0D]))
            input->num_stereo0D++;
    return BS_OK;
}

static bs_status read_output(bs_ctx *cx, bs_arena *home, int code, const inchi_Output *output,
                             bool key, char **out)
{
    char text[32] = "";

    if (code == inchi_Ret_FATAL && !output->szMessage)
        return bs_fail_memory(cx);
    if ((code != inchi_Ret_OKAY && code != inchi_Ret_WARNING) || !output->szInChI)
        return bs_fail(cx, BS_EVALUE, "no InChI for this molecule: %s",
                       output->szMessage && output->szMessage[0] ? output->szMessage
                                                                 : "the library gives no reason");
    if (!key)
        return bs_copy_text(cx, home, output->szInChI, strlen(output->szInChI), out);
    if (GetStdINCHIKeyFromStdINCHI(output->szInChI, text) != INCHIKEY_OK)
        return bs_fail(cx, BS_EVALUE, "no InChIKey for this molecule");
    return bs_copy_text(cx, home, text, strlen(text), out);
}

bs_status bs_inchi(bs_ctx *cx, bs_arena *home, const bs_mol *mol, bool key, char **out)
{
    bs_mark temp = bs_arena_mark(&cx->scratch);
    char options[] = "";
    inchi_Input input = {.szOptions = options};
    inchi_Output output = {0};
    int code = 0;
    bs_status st;

    *out = NULL;
    bs_spend(cx, 20000 + 2000 * (size_t)mol->atom_count);
    if (mol->atom_count == 0)
        return bs_fail(cx, BS_EVALUE, "no InChI for a molecule without atoms");
    st = fill_input(cx, mol, &input);
    if (st == BS_OK) {
        pthread_mutex_lock(&library_lock);
        code = GetStdINCHI(&input, &output);
    }
    /* `home` may be the scratch arena, so the input goes before the result comes. */
    bs_arena_rewind(&cx->scratch, temp);
    if (st == BS_OK) {
        st = read_output(cx, home, code, &output, key, out);
        FreeStdINCHI(&output);
        pthread_mutex_unlock(&library_lock);
    }
    return st;
}
