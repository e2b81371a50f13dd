/* The tags of tag.h. */
#include "search/tag.h"

#include "backsaw/draft.h"
#include "backsaw/format.h"

#include <string.h>

int bs_tag__of(const bs_mol *mol, int atom)
{
    int isotope = bs_mol_atom_isotope(mol, atom);

    return isotope >= BS_TAG_FIRST ? isotope - BS_TAG_FIRST : -1;
}

int bs_tag__find(const bs_mol *mol, int tag)
{
    for (int i = 0; i < bs_mol_atom_count(mol); i++) {
        if (bs_mol_atom_isotope(mol, i) == BS_TAG_FIRST + tag)
            return i;
    }
    return -1;
}

bool bs_tag__bonded(const bs_mol *mol, int a, int b)
{
    int first = bs_tag__find(mol, a), second = first < 0 ? -1 : bs_tag__find(mol, b);

    return second >= 0 && bs_mol_bond_between(mol, first, second) >= 0;
}

bs_status bs_tag__put(bs_ctx *cx, bs_arena *home, const bs_mol *mol, const uint16_t *isotope,
                      bs_mol **out)
{
    bs_draft draft;
    bs_status st;

    bs_draft_init(&draft, cx, home);
    if ((st = bs_draft_from_mol(&draft, mol)) != BS_OK)
        return st;
    for (uint32_t i = 0; i < draft.atom_count; i++) {
        if (isotope[i])
            draft.atoms[i].isotope = isotope[i];
        draft.atoms[i].label = 0;
    }
    return bs_draft_finish(&draft, home, NULL, out);
}

bool bs_tag__is_tagged(const char *smiles)
{
    for (const char *at = strchr(smiles, '['); at; at = strchr(at + 1, '[')) {
        if (at[1] >= '6' && at[1] <= '9' && at[2] >= '0' && at[2] <= '9' && at[3] >= '0' &&
            at[3] <= '9')
            return true;
    }
    return false;
}

bs_status bs_tag__strip(bs_ctx *cx, bs_arena *home, const bs_tags *tags, const bs_mol *mol,
                        bs_mol **out, char **smiles)
{
    bs_mol *plain;
    bs_draft draft;
    bs_status st;

    bs_draft_init(&draft, cx, home);
    if ((st = bs_draft_from_mol(&draft, mol)) != BS_OK)
        return st;
    for (uint32_t i = 0; i < draft.atom_count; i++) {
        int tag = bs_tag__of(mol, (int)i);

        if (tag >= 0 && tag < tags->count)
            draft.atoms[i].isotope = tags->isotope[tag];
    }
    if ((st = bs_draft_finish(&draft, home, NULL, &plain)) != BS_OK)
        return st;
    if (out)
        *out = plain;
    return smiles ? bs_smiles_canonical(cx, home, plain, 0, smiles) : BS_OK;
}

bs_status bs_tag__plain(bs_ctx *cx, bs_arena *home, const bs_tags *tags, const char *smiles,
                        const char **out)
{
    char *plain = NULL;
    bs_mol *mol;
    bs_status st;

    *out = smiles;
    if (tags->count == 0 || !bs_tag__is_tagged(smiles))
        return BS_OK;
    st = bs_smiles_read(cx, home, smiles, strlen(smiles), NULL, &mol);
    if (st == BS_OK)
        st = bs_tag__strip(cx, home, tags, mol, NULL, &plain);
    *out = plain;
    return st;
}
