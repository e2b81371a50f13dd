/* Electronic and steric effects of groups, told by their first atoms. */
#include "rule/substituent.h"

#include "chem/mol.h"

/* What hangs on an atom, the bond to `from` left out. */
typedef struct around {
    int carbons, halogens, heavy;
    bool double_oxygen, double_nitrogen, double_sulfur, double_carbon, triple_carbon,
        triple_nitrogen, acid_like, amide_like, acyl, sulfonyl, halide, aromatic, pulls, nitrogen;
} around;

static bool is_halogen(int element)
{
    return element == 9 || element == 17 || element == 35 || element == 53;
}

static int doubles_to(const bs_mol *mol, int atom, int element)
{
    int count = 0;

    for (int n = 0; n < bs_mol_atom_degree(mol, atom); n++) {
        int other, bond;

        bs_mol_neighbour(mol, atom, n, &other, &bond);
        count += bs_mol_bond_order(mol, bond) == 2 && bs_mol_atom_element(mol, other) == element &&
                 !bs_mol_bond_is_aromatic(mol, bond);
    }
    return count;
}

static void look_single(const bs_mol *mol, int other, around *a)
{
    int element = bs_mol_atom_element(mol, other);

    a->carbons += element == 6;
    a->halogens += is_halogen(element);
    a->halide = a->halide || (is_halogen(element) && element != 9);
    a->acid_like = a->acid_like || element == 8;
    a->nitrogen = a->nitrogen || element == 7;
    a->acyl = a->acyl || (element == 6 && doubles_to(mol, other, 8) > 0);
    a->sulfonyl = a->sulfonyl || (element == 16 && doubles_to(mol, other, 8) > 0);
    a->aromatic = a->aromatic || (element == 6 && bs_mol_atom_is_aromatic(mol, other));
}

static around look(const bs_mol *mol, int atom, int from)
{
    around a = {0};

    for (int n = 0; n < bs_mol_atom_degree(mol, atom); n++) {
        int other, bond, element, order;

        bs_mol_neighbour(mol, atom, n, &other, &bond);
        if (other == from)
            continue;
        element = bs_mol_atom_element(mol, other);
        order = bs_mol_bond_order(mol, bond);
        a.heavy += element != 1;
        if (order < 2 || bs_mol_bond_is_aromatic(mol, bond)) {
            look_single(mol, other, &a);
            continue;
        }
        a.double_oxygen = a.double_oxygen || (order == 2 && element == 8);
        a.double_nitrogen = a.double_nitrogen || (order == 2 && element == 7);
        a.double_sulfur = a.double_sulfur || (order == 2 && element == 16);
        a.double_carbon = a.double_carbon || (order == 2 && element == 6);
        a.triple_carbon = a.triple_carbon || (order == 3 && element == 6);
        a.triple_nitrogen = a.triple_nitrogen || (order == 3 && element == 7);
    }
    return a;
}

/* ---- Constants ------------------------------------------------------------------------------- */

typedef struct constants {
    double meta, plus, minus;
} constants;

static bool has_charge_beside(const bs_mol *mol, int atom)
{
    for (int n = 0; n < bs_mol_atom_degree(mol, atom); n++) {
        int other;

        bs_mol_neighbour(mol, atom, n, &other, NULL);
        if (bs_mol_atom_charge(mol, other) < 0)
            return true;
    }
    return false;
}

static constants of_carbon(const bs_mol *mol, int atom, int ring)
{
    around a = look(mol, atom, ring);
    int halogens = a.halogens;

    if (bs_mol_atom_is_aromatic(mol, atom))
        return (constants){0.06, -0.18, 0.02};
    if (a.triple_nitrogen)
        return (constants){0.56, 0.66, 1.0};
    if (a.double_oxygen && has_charge_beside(mol, atom))
        return (constants){-0.02, 0.02, 0.31};
    if (a.double_oxygen && a.halide)
        return (constants){0.51, 0.79, 1.24};
    if (a.double_oxygen && a.nitrogen)
        return (constants){0.28, 0.40, 0.61};
    if (a.double_oxygen && a.acid_like)
        return (constants){0.37, 0.48, 0.75};
    if (a.double_oxygen || a.double_sulfur)
        return (constants){0.37, 0.50, 0.90};
    if (a.double_nitrogen)
        return (constants){0.25, 0.35, 0.54};
    if (a.triple_carbon)
        return (constants){0.21, 0.18, 0.53};
    if (a.double_carbon)
        return (constants){0.06, -0.16, 0.1};
    if (halogens >= 3)
        return (constants){0.43, 0.61, 0.65};
    if (halogens == 2)
        return (constants){0.3, 0.35, 0.35};
    if (halogens == 1 || a.acid_like || a.nitrogen || a.acyl)
        return (constants){0.08, -0.01, 0.08};
    return a.carbons >= 3 ? (constants){-0.10, -0.26, -0.2} : (constants){-0.07, -0.31, -0.17};
}

static constants of_nitrogen(const bs_mol *mol, int atom, int ring)
{
    around a = look(mol, atom, ring);

    if (bs_mol_atom_charge(mol, atom) > 0)
        return a.double_oxygen ? (constants){0.71, 0.79, 1.27} : (constants){0.88, 1.0, 0.82};
    if (bs_mol_atom_is_aromatic(mol, atom))
        return (constants){0.22, -0.1, 0.3};
    if (a.double_oxygen)
        return (constants){0.62, 0.9, 1.4};
    if (a.double_nitrogen)
        return (constants){0.32, -0.19, 0.45};
    if (a.double_carbon)
        return (constants){-0.08, -0.5, -0.1};
    if (a.acyl || a.sulfonyl)
        return (constants){0.21, -0.60, 0.0};
    return a.carbons > 1 ? (constants){-0.16, -1.7, -0.7} : (constants){-0.16, -1.3, -0.6};
}

static constants of_oxygen(const bs_mol *mol, int atom, int ring)
{
    around a = look(mol, atom, ring);

    if (bs_mol_atom_charge(mol, ring) > 0)
        return (constants){0.8, -0.8, 0.8}; /* of an N-oxide, with its positive nitrogen */
    if (bs_mol_atom_charge(mol, atom) < 0)
        return (constants){-0.47, -2.3, -0.8};
    if (a.sulfonyl)
        return (constants){0.36, 0.10, 0.4};
    if (a.acyl)
        return (constants){0.39, -0.20, 0.3};
    if (a.aromatic)
        return (constants){0.25, -0.50, -0.1};
    return a.heavy == 0 ? (constants){0.12, -0.92, -0.37} : (constants){0.12, -0.78, -0.26};
}

static constants of_sulfur(const bs_mol *mol, int atom)
{
    int oxygens = doubles_to(mol, atom, 8);

    if (oxygens >= 2)
        return (constants){0.62, 0.72, 1.13};
    return oxygens == 1 ? (constants){0.52, 0.50, 0.73} : (constants){0.15, -0.60, 0.06};
}

static constants of_group(const bs_mol *mol, int ring, int first)
{
    switch (bs_mol_atom_element(mol, first)) {
    case 6:
        return of_carbon(mol, first, ring);
    case 7:
        return of_nitrogen(mol, first, ring);
    case 8:
        return of_oxygen(mol, first, ring);
    case 9:
        return (constants){0.34, -0.07, 0.06};
    case 15:
        return (constants){0.4, 0.5, 0.8};
    case 16:
    case 34:
        return of_sulfur(mol, first);
    case 17:
        return (constants){0.37, 0.11, 0.23};
    case 35:
        return (constants){0.39, 0.15, 0.25};
    case 53:
        return (constants){0.35, 0.13, 0.27};
    default:
        return (constants){0, 0, 0};
    }
}

bs_group_constants bs_substituent__constants(const bs_mol *mol, int ring, int first,
                                             bs_attack attack)
{
    constants c = of_group(mol, ring, first);

    return (bs_group_constants){c.meta, attack == BS_BY_ELECTROPHILE ? c.plus : c.minus};
}

/* ---- Size --------------------------------------------------------------------------------------
 */

double bs_substituent__size(const bs_mol *mol, int ring, int first)
{
    int element = bs_mol_atom_element(mol, first);
    around a = look(mol, first, ring);

    switch (element) {
    case 1:
        return 0;
    case 9:
        return 0.2;
    case 7:
        return a.heavy == 0 ? 0.3 : a.double_oxygen ? 0.8 : 0.6;
    case 8:
        return bs_mol_atom_charge(mol, ring) > 0 ? 2.5 : a.heavy == 0 ? 0.3 : 0.5;
    case 17:
        return 0.5;
    case 35:
        return 0.6;
    case 53:
        return 0.8;
    case 6:
        break;
    default:
        return 0.9;
    }
    if (a.triple_nitrogen || a.triple_carbon)
        return 0.3;
    if (a.double_oxygen || a.double_carbon || bs_mol_atom_is_aromatic(mol, first))
        return 0.8;
    return a.heavy == 0 ? 0.5 : a.heavy == 1 ? 0.6 : a.heavy == 2 ? 1.0 : 2.5;
}

/* ---- Charges
 * -------------------------------------------------------------------------------------- */

/* What one neighbour adds: columns cation, radical, anion. */
static double support(const bs_mol *mol, int atom, int other, bs_charge_kind kind)
{
    static const double alkyl[] = {1, 1, -0.6}, conjugated[] = {2.4, 2.6, 1.5};
    static const double lone_pair[] = {3.5, 1.2, -0.8}, acceptor[] = {-2.5, 1.6, 5};
    static const double halogen[] = {-0.3, 0.3, 0.8}, sulfur[] = {2.5, 1.5, 1.5};
    static const double poor[] = {-2.5, 0.2, 2.5}, silyl[] = {0.8, 0.5, 0.8};
    int element = bs_mol_atom_element(mol, other);
    around a = look(mol, other, atom);

    if (element == 6) {
        if (a.double_oxygen || a.double_nitrogen || a.triple_nitrogen || a.double_sulfur)
            return acceptor[kind] * (a.nitrogen || (a.acid_like && a.double_oxygen) ? 0.8 : 1);
        if (bs_mol_atom_is_aromatic(mol, other) || a.double_carbon || a.triple_carbon)
            return conjugated[kind] * (a.triple_carbon ? 0.6 : 1);
        return a.halogens >= 2 ? poor[kind] : alkyl[kind];
    }
    if (element == 7)
        return bs_mol_atom_charge(mol, other) > 0 ? acceptor[kind] * (a.double_oxygen ? 1.6 : 1)
                                                  : lone_pair[kind] * (a.acyl ? 0.7 : 1.3);
    if (element == 8)
        return lone_pair[kind] * (a.acyl || a.sulfonyl ? 0.3 : 1);
    if (element == 16)
        return doubles_to(mol, other, 8) > 0 ? acceptor[kind] * 0.9 : sulfur[kind];
    if (is_halogen(element))
        return halogen[kind];
    if (element == 15)
        return acceptor[kind] * 0.7;
    return element == 14 || element == 5 ? silyl[kind] : 0;
}

double bs_atom_stability(const bs_mol *mol, int atom, int skip, bs_charge_kind kind)
{
    double sum = 0;

    for (int n = 0; n < bs_mol_atom_degree(mol, atom); n++) {
        int other;

        bs_mol_neighbour(mol, atom, n, &other, NULL);
        if (other != skip)
            sum += support(mol, atom, other, kind);
    }
    return sum;
}
