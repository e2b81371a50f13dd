/* Reading the reaction from which a transform is drafted. */
#include <string.h>

#include "backsaw/format.h"
#include "rule/example.h"

/* ---- One side -------------------------------------------------------------------------------- */

static bs_status read_part(bs_example *ex, const char *text, size_t from, size_t to, bs_mol **out)
{
    size_t used;
    bs_status st = bs_smiles_read(ex->cx, ex->work, text + from, to - from, &used, out);

    if (st != BS_OK) {
        if (ex->cx->error.offset >= 0)
            ex->cx->error.offset += (long)from;
        return st;
    }
    if (used < to - from)
        return bs_fail_at(ex->cx, BS_ESYNTAX, from + used, "a blank in the reaction");
    return BS_OK;
}

static int order_of(const bs_mol *mol, int bond)
{
    int order = bs_mol_bond_order(mol, bond);

    if (bs_mol_bond_is_aromatic(mol, bond))
        return BS_EXAMPLE_AROMATIC;
    return order == 0 ? BS_EXAMPLE_DATIVE : order;
}

static void fill_atom(bs_example_side *side, int piece, int atom, int *bonds)
{
    const bs_mol *mol = side->pieces[piece];
    int self = side->first[piece] + atom;

    side->atoms[self] = (bs_example_atom){
        .element = bs_mol_atom_element(mol, atom),
        .charge = bs_mol_atom_charge(mol, atom),
        .hydrogens = bs_mol_atom_hydrogens(mol, atom),
        .isotope = bs_mol_atom_isotope(mol, atom),
        .label = bs_mol_atom_label(mol, atom),
        .aromatic = bs_mol_atom_is_aromatic(mol, atom),
        .piece = piece,
        .atom = atom,
    };
    side->start[self] = *bonds;
    for (int k = 0; k < bs_mol_atom_degree(mol, atom); k++) {
        int other, bond;

        bs_mol_neighbour(mol, atom, k, &other, &bond);
        other += side->first[piece];
        side->near[(*bonds)++] = other;
        side->order[self * side->count + other] = (uint8_t)order_of(mol, bond);
    }
    side->start[self + 1] = *bonds;
}

static bs_status fill_side(bs_example *ex, bs_example_side *side)
{
    int bonds = 0, room = 0;
    bs_status st;

    if ((st = bs_new(ex->cx, ex->work, side->piece_count + 1, &side->first)) != BS_OK ||
        (st = bs_new(ex->cx, ex->work, side->piece_count + 1, &side->compound)) != BS_OK)
        return st;
    side->count = 0;
    for (int i = 0; i < side->piece_count; i++) {
        side->first[i] = side->count;
        side->count += bs_mol_atom_count(side->pieces[i]);
        room += 2 * bs_mol_bond_count(side->pieces[i]);
        if (side->count > BS_EXAMPLE_ATOMS)
            return bs_fail(ex->cx, BS_ELIMIT, "a side of the reaction has more than %d atoms",
                           BS_EXAMPLE_ATOMS);
    }
    if ((st = bs_new(ex->cx, ex->work, side->count + 1, &side->atoms)) != BS_OK ||
        (st = bs_new(ex->cx, ex->work, side->count + 1, &side->start)) != BS_OK ||
        (st = bs_new(ex->cx, ex->work, room + 1, &side->near)) != BS_OK ||
        (st = bs_new(ex->cx, ex->work, side->count * side->count + 1, &side->order)) != BS_OK)
        return st;
    for (int i = 0; i < side->piece_count; i++) {
        for (int k = 0; k < bs_mol_atom_count(side->pieces[i]); k++)
            fill_atom(side, i, k, &bonds);
    }
    return BS_OK;
}

/* ---- Compounds ---------------------------------------------------------------------------------
 */

/* Ions are one compound with those that come next, until their charges are even. */
static void find_compounds(bs_example_side *side)
{
    for (int i = 0; i < side->piece_count; i++)
        side->compound[i] = -1;
    for (int i = 0; i < side->piece_count; i++) {
        int charge = bs_mol_charge(side->pieces[i]);

        if (side->compound[i] >= 0)
            continue;
        side->compound[i] = side->compound_count;
        for (int k = i + 1; k < side->piece_count && charge != 0; k++) {
            if (side->compound[k] >= 0 || bs_mol_charge(side->pieces[k]) == 0)
                continue;
            side->compound[k] = side->compound_count;
            charge += bs_mol_charge(side->pieces[k]);
        }
        side->compound_count++;
    }
}

/* The SMILES of pieces with dots between, read and written anew, so that it is the canonical one.
 */
static bs_status compound_smiles(bs_example *ex, bs_mol *const *pieces, const int *compound,
                                 int count, int which, char **out)
{
    bs_text text;
    bs_mol *mol;
    char *one;
    bs_status st = BS_OK;

    bs_text_init(&text, ex->cx);
    for (int i = 0; i < count && st == BS_OK; i++) {
        if (compound[i] != which)
            continue;
        st = bs_smiles_canonical(ex->cx, ex->work, pieces[i], 0, &one);
        if (st == BS_OK && text.length > 0)
            st = bs_text_putc(&text, '.');
        if (st == BS_OK)
            st = bs_text_puts(&text, one);
    }
    if (st == BS_OK && text.length > 0 &&
        (st = bs_smiles_read(ex->cx, ex->work, text.data, text.length, NULL, &mol)) == BS_OK)
        st = bs_smiles_canonical(ex->cx, ex->work, mol, 0, out);
    bs_text_free(&text);
    return st;
}

/* Keeps the largest of the products, the first of equals, and names the others. */
static bs_status choose_product(bs_example *ex)
{
    bs_example_side *side = &ex->product;
    int best = 0;
    bs_status st;

    for (int i = 1; i < side->piece_count; i++) {
        if (bs_mol_atom_count(side->pieces[i]) > bs_mol_atom_count(side->pieces[best]))
            best = i;
    }
    if (side->piece_count > 1) {
        int *rest;

        if ((st = bs_new(ex->cx, ex->work, side->piece_count, &rest)) != BS_OK)
            return st;
        rest[best] = 1;
        st = compound_smiles(ex, side->pieces, rest, side->piece_count, 0, &ex->left_out);
        if (st != BS_OK)
            return st;
    }
    side->pieces += best;
    side->piece_count = 1;
    return bs_smiles_canonical(ex->cx, ex->work, side->pieces[0], 0, &ex->product_smiles);
}

static bs_status name_precursors(bs_example *ex)
{
    bs_example_side *side = &ex->reactants;
    bs_status st = bs_new(ex->cx, ex->work, side->compound_count + 1, &ex->precursors);

    for (int i = 0; i < side->compound_count && st == BS_OK; i++)
        st = compound_smiles(ex, side->pieces, side->compound, side->piece_count, i,
                             &ex->precursors[ex->precursor_count++]);
    return st;
}

static bs_status read_agents(bs_example *ex, const char *text, size_t from, size_t to)
{
    bs_mol *mol, **pieces;
    bs_status st;

    if (from == to)
        return BS_OK;
    if ((st = read_part(ex, text, from, to, &mol)) != BS_OK ||
        (st = bs_mol_fragments(ex->cx, ex->work, mol, &pieces, &ex->agent_count)) != BS_OK ||
        (st = bs_new(ex->cx, ex->work, ex->agent_count + 1, &ex->agents)) != BS_OK)
        return st;
    for (int i = 0; i < ex->agent_count && st == BS_OK; i++)
        st = bs_smiles_canonical(ex->cx, ex->work, pieces[i], 0, &ex->agents[i]);
    return st;
}

static bs_status read_sides(bs_example *ex, const char *text, size_t length, size_t one, size_t two)
{
    bs_mol *left, *right;
    bs_status st;

    if (one == 0)
        return bs_fail_at(ex->cx, BS_ESYNTAX, 0, "expected the reactants before '>'");
    if (two + 1 == length)
        return bs_fail_at(ex->cx, BS_ESYNTAX, length, "expected the product behind '>'");
    if ((st = read_part(ex, text, 0, one, &left)) != BS_OK ||
        (st = read_agents(ex, text, one + 1, two)) != BS_OK ||
        (st = read_part(ex, text, two + 1, length, &right)) != BS_OK ||
        (st = bs_mol_fragments(ex->cx, ex->work, left, &ex->reactants.pieces,
                               &ex->reactants.piece_count)) != BS_OK)
        return st;
    return bs_mol_fragments(ex->cx, ex->work, right, &ex->product.pieces, &ex->product.piece_count);
}

bs_status bs_example__read(bs_example *ex, const char *text, size_t length)
{
    const char *one = memchr(text, '>', length);
    const char *two = one ? memchr(one + 1, '>', length - (size_t)(one + 1 - text)) : NULL;
    const char *more = two ? memchr(two + 1, '>', length - (size_t)(two + 1 - text)) : NULL;
    bs_status st;

    if (!two)
        return bs_fail_at(ex->cx, BS_ESYNTAX, length,
                          "expected a reaction, \"reactants>>product\", with two '>'");
    if (more)
        return bs_fail_at(ex->cx, BS_ESYNTAX, (size_t)(more - text), "a third '>' in the reaction");
    st = read_sides(ex, text, length, (size_t)(one - text), (size_t)(two - text));
    if (st == BS_OK && (ex->reactants.piece_count == 0 || ex->product.piece_count == 0))
        st = bs_fail(ex->cx, BS_EVALUE, "a side of the reaction has no atoms");
    if (st == BS_OK)
        st = choose_product(ex);
    if (st == BS_OK)
        st = fill_side(ex, &ex->reactants);
    if (st == BS_OK)
        st = fill_side(ex, &ex->product);
    if (st != BS_OK)
        return st;
    find_compounds(&ex->reactants);
    return name_precursors(ex);
}
