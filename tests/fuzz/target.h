/* What the fuzz targets share: a context and an arena for one input, and the test of sameness. */
#ifndef FUZZ_TARGET_H
#define FUZZ_TARGET_H

#include <stdio.h>
#include <stdlib.h>
#include <string.h>

#include "backsaw/file.h"
#include "backsaw/format.h"

int LLVMFuzzerTestOneInput(const uint8_t *data, size_t size);

typedef struct target {
    bs_ctx cx;
    bs_arena home;
} target;

static inline void target_open(target *t)
{
    bs_ctx_init(&t->cx, NULL);
    bs_arena_init(&t->home, t->cx.gate);
}

static inline void target_close(target *t)
{
    bs_arena_free(&t->home);
    bs_ctx_free(&t->cx);
}

/* Reads a SMILES; NULL if it is refused. */
static inline bs_mol *target_read(target *t, const char *text, size_t length)
{
    bs_mol *mol;

    return bs_smiles_read(&t->cx, &t->home, text, length, NULL, &mol) == BS_OK ? mol : NULL;
}

/* The canonical SMILES; NULL if the molecule is too symmetrical for the bound. */
static inline char *target_name(target *t, const bs_mol *mol)
{
    char *text;

    return bs_smiles_canonical(&t->cx, &t->home, mol, 0, &text) == BS_OK ? text : NULL;
}

static inline void target_fail(target *t, const char *what, const char *one, const char *other)
{
    fprintf(stderr, "%s: %s and %s (%s)\n", what, one, other, t->cx.error.message);
    abort();
}

/* What was written must be read again, as the molecule with this name. */
static inline void target_expect(target *t, const char *what, const bs_mol *mol, const char *name)
{
    const char *again = target_name(t, mol);

    if (!again || strcmp(again, name) != 0)
        target_fail(t, what, name, again ? again : "nothing");
}

#endif
