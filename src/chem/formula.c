/* Molecular formula and masses. */
#include "chem/element.h"
#include "chem/mol.h"

#include <string.h>

/* Electron mass in u: CODATA 2018. */
#define ELECTRON_MASS 5.48579909065e-4

static bs_status write_count(bs_text *text, int element, uint32_t count)
{
    if (count == 0)
        return BS_OK;
    if (count == 1)
        return bs_text_puts(text, bs_element_symbol(element));
    return bs_text_printf(text, "%s%lu", bs_element_symbol(element), (unsigned long)count);
}

/* The elements in the order of their symbols; carbon and hydrogen only if not done yet. */
static bs_status write_rest(bs_text *text, const uint32_t *counts, bool carbon_done)
{
    bs_status st = BS_OK;
    const char *last = "";

    for (int left = BS_ELEMENT_COUNT; left > 0 && st == BS_OK; left--) {
        int next = 0;

        for (int z = 1; z < BS_ELEMENT_COUNT; z++) {
            const char *symbol = bs_element_symbol(z);

            if (counts[z] == 0 || strcmp(symbol, last) <= 0 || (carbon_done && (z == 1 || z == 6)))
                continue;
            if (next == 0 || strcmp(symbol, bs_element_symbol(next)) < 0)
                next = z;
        }
        if (next == 0)
            break;
        st = write_count(text, next, counts[next]);
        last = bs_element_symbol(next);
    }
    return st;
}

bs_status bs_mol_formula(bs_ctx *cx, bs_arena *home, const bs_mol *mol, char **out)
{
    uint32_t counts[BS_ELEMENT_COUNT] = {0};
    bs_text text;
    bs_status st = BS_OK;

    *out = NULL;
    bs_text_init(&text, cx);
    for (uint32_t i = 0; i < mol->atom_count; i++) {
        counts[mol->atoms[i].element]++;
        counts[1] += mol->atoms[i].hydrogens;
    }
    if (counts[6] > 0 && (st = write_count(&text, 6, counts[6])) == BS_OK)
        st = write_count(&text, 1, counts[1]);
    if (st == BS_OK)
        st = write_rest(&text, counts, counts[6] > 0);
    if (st == BS_OK)
        st = bs_copy_text(cx, home, text.data ? text.data : "", text.length, out);
    bs_text_free(&text);
    return st;
}

/* Adds up `mass` of each atom; 0 is an element that has none. */
static bs_status add_masses(bs_ctx *cx, const bs_mol *mol, double (*mass)(int), const char *what,
                            double *sum)
{
    *sum = 0;
    for (uint32_t i = 0; i < mol->atom_count; i++) {
        const bs_atom *a = &mol->atoms[i];
        double own = a->isotope ? bs_isotope__mass(a->element, a->isotope) : mass(a->element);

        if (own == 0)
            return bs_fail(cx, BS_EVALUE, "%s has no %s; state its isotope",
                           a->element ? bs_element_symbol(a->element) : "the unknown atom *", what);
        *sum += own + a->hydrogens * mass(1);
    }
    return BS_OK;
}

bs_status bs_mol_mass(bs_ctx *cx, const bs_mol *mol, double *mass_g_per_mol)
{
    return add_masses(cx, mol, bs_element__weight, "standard atomic weight", mass_g_per_mol);
}

bs_status bs_mol_exact_mass(bs_ctx *cx, const bs_mol *mol, double *mass_u)
{
    bs_status st = add_masses(cx, mol, bs_element__main_mass, "natural isotope", mass_u);

    *mass_u -= mol->charge * ELECTRON_MASS;
    return st;
}
