/* Comparing molecules in tests: by canonical SMILES. */
#ifndef SUPPORT_MOLECULE_H
#define SUPPORT_MOLECULE_H

#include <string.h>

#include "backsaw/format.h"
#include "support/check.h"

static inline bs_mol *molecule_read(fixture *f, const char *smiles)
{
    bs_mol *mol;

    check_ok(f, bs_smiles_read(&f->cx, &f->home, smiles, strlen(smiles), NULL, &mol));
    return mol;
}

/* Canonical SMILES with labels. */
static inline char *molecule_text(fixture *f, const bs_mol *mol)
{
    char *out;

    check_ok(f, bs_smiles_canonical(&f->cx, &f->home, mol, BS_SMILES_LABELS, &out));
    return out;
}

/* Fails unless the molecule is the one that the SMILES says. */
static inline void check_molecule(fixture *f, const bs_mol *mol, const char *smiles)
{
    assert_string_equal(molecule_text(f, mol), molecule_text(f, molecule_read(f, smiles)));
}

#endif
