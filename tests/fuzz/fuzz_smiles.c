/* Fuzz entry of the SMILES reader: what is read is a fixed point of canonical writing. */
#include "target.h"

int LLVMFuzzerTestOneInput(const uint8_t *data, size_t size)
{
    target t;
    bs_mol *mol;
    const char *name;

    target_open(&t);
    if ((mol = target_read(&t, (const char *)data, size)) && (name = target_name(&t, mol))) {
        mol = target_read(&t, name, strlen(name));
        if (!mol)
            target_fail(&t, "written, but not read", name, "nothing");
        target_expect(&t, "no fixed point", mol, name);
    }
    target_close(&t);
    return 0;
}
