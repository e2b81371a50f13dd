/*
 * Fuzz entry of the SMILES reader and writer: what is read has to be a fixed point of canonical
 * writing. Start with the strings of tests/data/oracle/smiles-conformance.tsv as corpus.
 */
#include <stdlib.h>
#include <string.h>

#include "backsaw/format.h"

int LLVMFuzzerTestOneInput(const uint8_t *data, size_t size);

int LLVMFuzzerTestOneInput(const uint8_t *data, size_t size)
{
    bs_ctx cx;
    bs_arena home;
    bs_mol *mol;
    char *first;
    char *second;

    bs_ctx_init(&cx, NULL);
    bs_arena_init(&home, cx.gate);
    if (bs_smiles_read(&cx, &home, (const char *)data, size, NULL, &mol) == BS_OK &&
        bs_smiles_canonical(&cx, &home, mol, 0, &first) == BS_OK) {
        if (bs_smiles_read(&cx, &home, first, strlen(first), NULL, &mol) != BS_OK ||
            bs_smiles_canonical(&cx, &home, mol, 0, &second) != BS_OK ||
            strcmp(first, second) != 0)
            abort();
    }
    bs_arena_free(&home);
    bs_ctx_free(&cx);
    return 0;
}
