/* What the tests of rules share: molecules from SMILES, and sets of products as text. */
#ifndef RULE_CASE_H
#define RULE_CASE_H

#include <stdlib.h>
#include <string.h>

#include "support/check.h"

#include "backsaw/format.h"
#include "backsaw/rule.h"

static inline bs_mol *read_mol(fixture *f, const char *smiles)
{
    bs_mol *mol = NULL;

    if (bs_smiles_read(&f->cx, &f->home, smiles, strlen(smiles), NULL, &mol) != BS_OK)
        fail_msg("%s: %s", smiles, f->cx.error.message);
    return mol;
}

static inline int compare_text(const void *a, const void *b)
{
    const char *const *x = a, *const *y = b;

    return strcmp(*x, *y);
}

/* The canonical SMILES of some molecules, in order, joined by spaces. */
static inline char *join_smiles(fixture *f, char **smiles, int count)
{
    size_t length = 1;
    char *text = NULL;

    for (int i = 0; i < count; i++)
        length += strlen(smiles[i]) + 1;
    check_ok(f, bs_new(&f->cx, &f->home, length, &text));
    qsort(smiles, (size_t)count, sizeof *smiles, compare_text);
    for (int i = 0; i < count; i++) {
        strcat(text, smiles[i]);
        if (i + 1 < count)
            strcat(text, " ");
    }
    return text;
}

static inline char *canonical(fixture *f, const char *smiles)
{
    char *text = NULL;

    check_ok(f, bs_smiles_canonical(&f->cx, &f->home, read_mol(f, smiles), 0, &text));
    return text;
}

/* The pieces of a dotted SMILES, each canonical, in order, joined by spaces. */
static inline char *canonical_pieces(fixture *f, const char *smiles)
{
    bs_mol **pieces = NULL;
    char **texts = NULL;
    int count = 0;

    check_ok(f, bs_mol_fragments(&f->cx, &f->home, read_mol(f, smiles), &pieces, &count));
    check_ok(f, bs_new(&f->cx, &f->home, count + 1, &texts));
    for (int i = 0; i < count; i++)
        check_ok(f, bs_smiles_canonical(&f->cx, &f->home, pieces[i], 0, &texts[i]));
    return join_smiles(f, texts, count);
}

/* The products of an outcome, piece by piece. */
static inline char *outcome_text(fixture *f, const bs_outcome *outcome)
{
    char **texts = NULL;

    check_ok(f, bs_new(&f->cx, &f->home, outcome->product_count + 1, &texts));
    for (int i = 0; i < outcome->product_count; i++)
        texts[i] = outcome->smiles[i];
    return join_smiles(f, texts, outcome->product_count);
}

#endif
