/*
 * Fuzz entry of the writers against the readers: a molecule that is written in its own order, as a
 * molfile of either version, and with its atoms in canonical order, is the same when it is read.
 */
#include "target.h"

/* Molfiles cannot hold everything; the drawing of large molecules takes long. */
enum { LARGEST_DRAWN = 40 };

static void through_molfile(target *t, const bs_mol *mol, const char *name,
                            bs_molfile_version version)
{
    bs_text text;
    bs_record *record;
    int lost = 0;

    bs_text_init(&text, &t->cx);
    if (bs_molfile_write(&text, mol, "", version, &lost) == BS_OK && lost == 0) {
        if (bs_molfile_read(&t->cx, &t->home, text.data, text.length, &record) != BS_OK)
            target_fail(t, "molfile not read", name, text.data);
        target_expect(t, text.data, record->mol, name);
    }
    bs_text_free(&text);
}

/* Molfiles keep no labels and no radicals apart from hydrogens, and know no bond of order 4. */
static bool fits_molfile(const bs_mol *mol)
{
    if (bs_mol_atom_count(mol) > LARGEST_DRAWN)
        return false;
    for (int i = 0; i < bs_mol_bond_count(mol); i++) {
        if (bs_mol_bond_order(mol, i) == 0 || bs_mol_bond_order(mol, i) > 3)
            return false;
    }
    return true;
}

int LLVMFuzzerTestOneInput(const uint8_t *data, size_t size)
{
    target t;
    bs_mol *mol;
    const char *name;
    char *text;

    target_open(&t);
    if ((mol = target_read(&t, (const char *)data, size)) && (name = target_name(&t, mol))) {
        if (bs_smiles_write(&t.cx, &t.home, mol, BS_SMILES_LABELS, &text) == BS_OK) {
            bs_mol *again = target_read(&t, text, strlen(text));

            if (!again)
                target_fail(&t, "written, but not read", name, text);
            target_expect(&t, text, again, name);
        }
        if (fits_molfile(mol)) {
            through_molfile(&t, mol, name, BS_MOLFILE_V2000);
            through_molfile(&t, mol, name, BS_MOLFILE_V3000);
        }
    }
    target_close(&t);
    return 0;
}
