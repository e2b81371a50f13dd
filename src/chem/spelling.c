/*
 * Charged and uncharged spellings of the same group. Which one stays is the common choice: charges
 * for elements of the second row, which do not expand their octet, and double bonds for those
 * below.
 */
#include "chem/spelling.h"
#include "chem/draft.h"
#include "chem/valence.h"

int bs_spelling__bond_sum(const bs_mol *mol, uint32_t atom)
{
    const bs_bond *bonds = bs_mol__bonds(mol);
    const bs_link *links = bs_mol__links(mol, atom);
    int sum = 0;

    for (int k = 0; k < mol->atoms[atom].degree; k++)
        sum += (int)bonds[links[k].bond].order;
    return sum;
}

/* Hydrogens that the atom will have. */
static int hydrogens_of(const bs_mol *mol, const int16_t *stated, uint32_t atom)
{
    const bs_atom *a = &mol->atoms[atom];
    int bonds = bs_spelling__bond_sum(mol, atom) + a->hydrogens;

    if (stated[atom] != BS_DRAFT_IMPLIED)
        return a->hydrogens;
    return a->hydrogens + bs_valence__implied(a->element, a->charge, bonds);
}

/* Moves `by` electron pairs from the bond to `other`, or back; the hydrogens stay. */
static void shift(bs_mol *mol, int16_t *stated, uint32_t atom, const bs_link *link, int by)
{
    bs_bond *bond = &bs_mol__bonds_mutable(mol)[link->bond];
    uint32_t ends[2] = {atom, link->atom};

    for (int i = 0; i < 2; i++) {
        bs_atom *a = &mol->atoms[ends[i]];

        a->hydrogens = (uint8_t)hydrogens_of(mol, stated, ends[i]);
        stated[ends[i]] = a->hydrogens;
    }
    bond->order = (unsigned)((int)bond->order - by);
    mol->atoms[atom].charge = (int8_t)(mol->atoms[atom].charge + by);
    mol->atoms[link->atom].charge = (int8_t)(mol->atoms[link->atom].charge - by);
}

/* ---- Nitrogen with five bonds -----------------------------------------------------------------
 */

/* How willingly a terminal atom takes the charge of a nitrogen with five bonds; 0 for not. */
static int takes_charge(const bs_mol *mol, const int16_t *stated, uint32_t atom, unsigned order)
{
    const bs_atom *a = &mol->atoms[atom];

    if (order < 2 || a->degree != 1 || a->charge != 0 || hydrogens_of(mol, stated, atom) != 0)
        return 0;
    if (order == 2)
        return a->element == 8 ? 4 : a->element == 16 ? 3 : a->element == 34 ? 2 : 0;
    return order == 3 && a->element == 7 ? 1 : 0;
}

static void separate_charges(bs_mol *mol, int16_t *stated, uint32_t atom)
{
    const bs_bond *bonds = bs_mol__bonds(mol);
    const bs_link *links = bs_mol__links(mol, atom);
    const bs_atom *a = &mol->atoms[atom];
    int best = 0;
    int at = 0;

    if (a->charge != 0 || bs_spelling__bond_sum(mol, atom) + hydrogens_of(mol, stated, atom) != 5)
        return;
    for (int k = 0; k < a->degree; k++) {
        int taste = takes_charge(mol, stated, links[k].atom, bonds[links[k].bond].order);

        if (taste > best) {
            best = taste;
            at = k;
        }
    }
    if (best > 0)
        shift(mol, stated, atom, &links[at], 1);
}

/* ---- Azides and diazo compounds
 * ------------------------------------------------------------------ */

/* Whether the atom is N- or C- with single bonds only. */
static bool is_anion(const bs_mol *mol, uint32_t atom)
{
    const bs_atom *a = &mol->atoms[atom];

    return (a->element == 7 || a->element == 6) && a->charge == -1 &&
           bs_spelling__bond_sum(mol, atom) == a->degree;
}

/* [N-][N+]#N: the charge goes to the end. */
static void turn_azide(bs_mol *mol, int16_t *stated, uint32_t atom)
{
    const bs_bond *bonds = bs_mol__bonds(mol);
    const bs_link *links = bs_mol__links(mol, atom);
    const bs_atom *a = &mol->atoms[atom];

    if (a->charge != 1 || a->degree != 2)
        return;
    for (int k = 0; k < 2; k++) {
        const bs_atom *end = &mol->atoms[links[k].atom];

        if (bonds[links[k].bond].order != 3 || end->element != 7 || end->charge != 0 ||
            end->degree != 1 || hydrogens_of(mol, stated, links[k].atom) != 0 ||
            bonds[links[1 - k].bond].order != 1 || !is_anion(mol, links[1 - k].atom))
            continue;
        shift(mol, stated, atom, &links[k], 1);
        shift(mol, stated, atom, &links[1 - k], -1);
        return;
    }
}

/* ---- Elements that expand their octet
 * ---------------------------------------------------------------- */

static bool expands(int element)
{
    return (element >= 15 && element <= 17) || (element >= 33 && element <= 35) ||
           (element >= 51 && element <= 53);
}

/* How willingly a neighbour with a negative charge gives it up for a double bond; 0 for not. */
static int gives_charge(const bs_mol *mol, const int16_t *stated, uint32_t atom)
{
    const bs_atom *a = &mol->atoms[atom];

    if (is_anion(mol, atom))
        return a->element == 7 ? 2 : 1;
    if (a->charge != -1 || a->degree != 1 || hydrogens_of(mol, stated, atom) != 0)
        return 0;
    return a->element == 8 ? 5 : a->element == 16 ? 4 : a->element == 34 ? 3 : 0;
}

/*
 * Takes one charge from a positive atom. Where two unlike N- or C- could give the bond, the choice
 * would hang on the order of the atoms, and the charges stay.
 */
static bool join_charges(bs_mol *mol, int16_t *stated, uint32_t atom)
{
    const bs_bond *bonds = bs_mol__bonds(mol);
    const bs_link *links = bs_mol__links(mol, atom);
    const bs_atom *a = &mol->atoms[atom];
    int valence = bs_spelling__bond_sum(mol, atom) + hydrogens_of(mol, stated, atom);
    int best = 0;
    int as_good = 0;
    int at = 0;

    if (a->charge <= 0 || !bs_valence__is_usual(a->element, a->charge - 1, valence + 1))
        return false;
    for (int k = 0; k < a->degree; k++) {
        int taste = bonds[links[k].bond].order == 1 ? gives_charge(mol, stated, links[k].atom) : 0;

        if (taste > best) {
            at = k;
            as_good = 0;
        }
        best = taste > best ? taste : best;
        as_good += taste == best;
    }
    if (best == 0 || (best < 3 && as_good > a->charge))
        return false;
    shift(mol, stated, atom, &links[at], -1);
    return true;
}

void bs_spelling__unify(bs_mol *mol, int16_t *stated)
{
    for (uint32_t i = 0; i < mol->atom_count; i++) {
        if (mol->atoms[i].element == 7) {
            separate_charges(mol, stated, i);
            turn_azide(mol, stated, i);
        }
        while (expands(mol->atoms[i].element) && join_charges(mol, stated, i))
            continue;
    }
}
