/* Fuzz entry of the readers of molfiles and SD records: what is read has a canonical form that
 * lasts. */
#include "target.h"

#include "format/sdf.h"

/* SMILES has single bonds for coordinate ones, so that they do not last. */
static bool has_coordinate_bond(const bs_mol *mol)
{
    for (int i = 0; i < bs_mol_bond_count(mol); i++) {
        if (bs_mol_bond_order(mol, i) == 0)
            return true;
    }
    return false;
}

int LLVMFuzzerTestOneInput(const uint8_t *data, size_t size)
{
    target t;
    bs_record record;
    const char *name;
    bs_mol *mol;

    target_open(&t);
    if (bs_sdf__read(&t.cx, &t.home, (const char *)data, size, 1, &record) == BS_OK &&
        bs_mol_atom_count(record.mol) > 0 && !has_coordinate_bond(record.mol) &&
        (name = target_name(&t, record.mol))) {
        mol = target_read(&t, name, strlen(name));
        if (!mol)
            target_fail(&t, "written, but not read", name, "nothing");
        target_expect(&t, "no fixed point", mol, name);
    }
    target_close(&t);
    return 0;
}
