/*
 * Prints canonical SMILES, formula and molar mass of the SMILES on its command line.
 *
 *     cc formula.c $(pkg-config --cflags --libs backsaw) -o formula
 */
#include <stdio.h>
#include <string.h>

#include <backsaw/format.h>

static bs_status describe(bs_ctx *cx, bs_arena *home, const char *text)
{
    bs_mol *mol;
    char *smiles, *formula;
    double mass;
    bs_status st;

    if ((st = bs_smiles_read(cx, home, text, strlen(text), NULL, &mol)) != BS_OK ||
        (st = bs_smiles_canonical(cx, home, mol, 0, &smiles)) != BS_OK ||
        (st = bs_mol_formula(cx, home, mol, &formula)) != BS_OK ||
        (st = bs_mol_mass(cx, mol, &mass)) != BS_OK)
        return st;
    printf("%s  %s  %.3f g/mol\n", smiles, formula, mass);
    return BS_OK;
}

int main(int argc, char **argv)
{
    bs_ctx cx;
    bs_arena home;
    int failed = argc < 2;

    bs_ctx_init(&cx, NULL);
    bs_arena_init(&home, cx.gate);
    for (int i = 1; i < argc; i++) {
        if (describe(&cx, &home, argv[i]) != BS_OK) {
            fprintf(stderr, "%s: %s\n", argv[i], cx.error.message);
            failed = 1;
        }
    }
    bs_arena_free(&home);
    bs_ctx_free(&cx);
    return failed;
}
