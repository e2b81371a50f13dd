/*
 * Fuzz entry of rewriting: a line of reaction SMARTS, then a molecule a line. Products of
 * molecules with common valences have common valences, and canonical forms that last.
 */
#include "target.h"

#include "backsaw/rule.h"
#include "chem/mol.h"

enum { MOST = 4 };

static bool is_odd(const bs_mol *mol)
{
    for (uint32_t i = 0; i < mol->atom_count; i++) {
        if (mol->atoms[i].flags & BS_ATOM_ODD)
            return true;
    }
    return false;
}

static void check_product(target *t, const bs_mol *mol, const char *name, bool odd)
{
    const bs_mol *again = target_read(t, name, strlen(name));

    if (!odd && is_odd(mol))
        target_fail(t, "impossible valence", name, "usual ones");
    if (!again)
        target_fail(t, "product written, but not read", name, "nothing");
    target_expect(t, "no fixed point", again, name);
}

static void apply(target *t, const bs_rewrite *rewrite, const bs_mol *const *mols, int count)
{
    bs_outcomes found;
    bool odd = false;

    for (int i = 0; i < count; i++)
        odd = odd || is_odd(mols[i]);
    if (bs_rewrite_apply(&t->cx, &t->home, rewrite, mols, count, &found) != BS_OK)
        return;
    for (int i = 0; i < found.count && i < 20; i++) {
        for (int k = 0; k < found.items[i].product_count; k++)
            check_product(t, found.items[i].products[k], found.items[i].smiles[k], odd);
    }
}

/* The length of the line at the start of a text. */
static size_t line_length(const char *text, size_t size)
{
    const char *end = memchr(text, '\n', size);

    return end ? (size_t)(end - text) : size;
}

int LLVMFuzzerTestOneInput(const uint8_t *data, size_t size)
{
    const char *text = (const char *)data;
    size_t length = line_length(text, size);
    const bs_mol *mols[MOST];
    bs_rewrite *rewrite;
    target t;
    int count = 0;

    target_open(&t);
    if (bs_rewrite_read(&t.cx, &t.home, text, length, &rewrite) == BS_OK) {
        while (length < size && count < MOST) {
            text += length + 1;
            size -= length + 1;
            length = line_length(text, size);
            if (!(mols[count] = target_read(&t, text, length)))
                break;
            count++;
        }
        if (count > 0 && count == bs_rewrite_reactant_count(rewrite))
            apply(&t, rewrite, mols, count);
    }
    target_close(&t);
    return 0;
}
