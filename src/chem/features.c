/*
 * Features of molecules for the screens of match.
 *
 * Word 0: 0-14 the classes; 15-22 aromatic and aliphatic C, N, O, S; 23 any aromatic atom;
 * 24-37 with hydrogens; 38-41 charges; 42-49 rings; 50-57 neighbours; 58, 59 heavy halogens;
 * 62, 63 stereo.
 * Word 1: 0-51 bonds; 52-63 numbers of atoms.
 */
#include "chem/features.h"

#include <string.h>

#define BIT(n) ((uint64_t)1 << (n))

int bs_feature__class(int element)
{
    /* One more than the class; 0 stands for those that are not listed. */
    static const uint8_t table[256] = {
        [1] = BS_CLASS_H + 1,       [3] = BS_CLASS_ALKALI + 1,  [4] = BS_CLASS_ALKALI + 1,
        [5] = BS_CLASS_B + 1,       [6] = BS_CLASS_C + 1,       [7] = BS_CLASS_N + 1,
        [8] = BS_CLASS_O + 1,       [9] = BS_CLASS_F + 1,       [11] = BS_CLASS_ALKALI + 1,
        [12] = BS_CLASS_ALKALI + 1, [14] = BS_CLASS_SI + 1,     [15] = BS_CLASS_P + 1,
        [16] = BS_CLASS_S + 1,      [17] = BS_CLASS_CL + 1,     [19] = BS_CLASS_ALKALI + 1,
        [20] = BS_CLASS_ALKALI + 1, [34] = BS_CLASS_SE + 1,     [35] = BS_CLASS_BR + 1,
        [37] = BS_CLASS_ALKALI + 1, [38] = BS_CLASS_ALKALI + 1, [53] = BS_CLASS_I + 1,
        [55] = BS_CLASS_ALKALI + 1, [56] = BS_CLASS_ALKALI + 1,
    };
    int found = table[element & 0xFF];

    return found ? found - 1 : BS_CLASS_OTHER;
}

int bs_feature__element(int class)
{
    static const uint8_t table[BS_CLASS_COUNT] = {6, 7, 8, 16, 9, 17, 35, 53, 15, 14, 5, 1, 34, 11};

    return table[class];
}

bs_features bs_feature__atom(int class, bool aromatic)
{
    bs_features f = {{BIT(class), 0}};

    if (class <= BS_CLASS_S)
        f.word[0] |= BIT(15 + 2 * class + !aromatic);
    if (class == BS_CLASS_CL || class == BS_CLASS_BR || class == BS_CLASS_I)
        f.word[0] |= BIT(58) | (class == BS_CLASS_CL ? 0 : BIT(59));
    if (aromatic)
        f.word[0] |= BIT(23);
    return f;
}

bs_features bs_feature__hydrogens(int class, bool aromatic, int hydrogens)
{
    bs_features f = {{0, 0}};
    uint64_t bits = 0;

    switch (class) {
    case BS_CLASS_C:
        if (aromatic)
            bits |= hydrogens > 0 ? BIT(24) : BIT(25);
        else
            bits |= hydrogens == 0 ? BIT(26) : BIT(27);
        if (!aromatic && hydrogens >= 2)
            bits |= BIT(28);
        if (!aromatic && hydrogens >= 3)
            bits |= BIT(29);
        if (!aromatic && hydrogens == 1)
            bits |= BIT(30);
        break;
    case BS_CLASS_N:
        if (hydrogens > 0)
            bits |= aromatic ? BIT(31) : BIT(32);
        if (hydrogens >= 2)
            bits |= BIT(33);
        if (hydrogens == 0)
            bits |= aromatic ? 0 : BIT(34);
        break;
    case BS_CLASS_O:
        bits |= hydrogens > 0 ? BIT(35) : BIT(36);
        break;
    case BS_CLASS_S:
        bits |= hydrogens > 0 ? BIT(37) : 0;
        break;
    default:
        break;
    }
    f.word[0] = bits;
    return f;
}

bs_features bs_feature__charge(int class, int sign)
{
    bs_features f = {{0, 0}};

    if (sign > 0)
        f.word[0] = BIT(38) | (class == BS_CLASS_N ? BIT(39) : 0);
    else if (sign < 0)
        f.word[0] = BIT(40) | (class == BS_CLASS_O ? BIT(41) : 0);
    return f;
}

bs_features bs_feature__degree(int class, bool aromatic, int degree)
{
    bs_features f = {{0, 0}};

    switch (class) {
    case BS_CLASS_C:
        if (!aromatic && degree >= 3)
            f.word[0] |= BIT(50);
        if (degree >= 4)
            f.word[0] |= BIT(51);
        break;
    case BS_CLASS_N:
        if (!aromatic && degree >= 2)
            f.word[0] |= BIT(52);
        if (degree >= 3)
            f.word[0] |= BIT(53);
        break;
    case BS_CLASS_O:
        f.word[0] |= degree >= 2 ? BIT(54) : 0;
        break;
    case BS_CLASS_S:
        f.word[0] |= degree >= 3 ? BIT(55) : 0;
        f.word[0] |= degree >= 4 ? BIT(56) : 0;
        break;
    case BS_CLASS_P:
        f.word[0] |= degree >= 4 ? BIT(57) : 0;
        break;
    default:
        break;
    }
    return f;
}

bs_features bs_feature__ring(int class, bool aromatic, int size)
{
    bs_features f = {{0, 0}};

    if (size == 0)
        return f;
    f.word[0] = BIT(42);
    if (size >= 3 && size <= 7)
        f.word[0] |= BIT(43 + size - 3);
    if (class == BS_CLASS_C && !aromatic)
        f.word[0] |= BIT(48);
    return f;
}

bs_features bs_feature__ring_bonds(int count)
{
    return (bs_features){{count >= 3 ? BIT(49) : 0, 0}};
}

/* ---- Bonds ----------------------------------------------------------------------------- */

/* Carbon to something by a single bond, once for aliphatic carbon, once for aromatic. */
static int carbon_bit(int class, bool aromatic)
{
    static const int8_t aliphatic[BS_CLASS_COUNT] = {0, 1, 2,  3,  4,  5,  6, 7,
                                                     8, 9, 10, 11, 11, 11, 11};
    static const int8_t ring[BS_CLASS_COUNT] = {12, 13, 14, 15, 16, 17, 18, 19,
                                                20, 20, 20, 20, 20, 20, 20};

    return aromatic ? ring[class] : aliphatic[class];
}

/* Two heteroatoms by a single bond. */
static int hetero_bit(int a, int b)
{
    if (a > b) {
        int swap = a;
        a = b;
        b = swap;
    }
    if (a == BS_CLASS_N)
        return b == BS_CLASS_N ? 21 : b == BS_CLASS_O ? 22 : b == BS_CLASS_S ? 23 : 24;
    if (a == BS_CLASS_O)
        return b == BS_CLASS_O    ? 25
               : b == BS_CLASS_S  ? 26
               : b == BS_CLASS_P  ? 27
               : b == BS_CLASS_SI ? 28
               : b == BS_CLASS_B  ? 29
                                  : 30;
    return a == BS_CLASS_S && b == BS_CLASS_S ? 31 : 32;
}

static int double_bit(int a, int b)
{
    if (a > b) {
        int swap = a;
        a = b;
        b = swap;
    }
    if (a == BS_CLASS_C)
        return b <= BS_CLASS_S ? 33 + b : 37;
    if (b == BS_CLASS_O)
        return 38;
    if (a == BS_CLASS_N)
        return b == BS_CLASS_N ? 39 : 40;
    if (a == BS_CLASS_O)
        return b == BS_CLASS_S ? 41 : b == BS_CLASS_P ? 42 : 43;
    return 43;
}

bs_features bs_feature__bond(int class_a, bool aromatic_a, int class_b, bool aromatic_b, int order,
                             bool aromatic, bool ring)
{
    bs_features f = {{0, 0}};
    uint64_t bits = 0;

    if (aromatic) {
        bits |= BIT(46);
        if (class_a == BS_CLASS_C && class_b == BS_CLASS_C)
            bits |= BIT(47);
        else if (class_a == BS_CLASS_C || class_b == BS_CLASS_C)
            bits |= BIT(48);
        else
            bits |= BIT(49);
    } else if (order == 1) {
        if (class_a == BS_CLASS_C)
            bits |= BIT(carbon_bit(class_b, aromatic_a));
        if (class_b == BS_CLASS_C)
            bits |= BIT(carbon_bit(class_a, aromatic_b));
        if (class_a != BS_CLASS_C && class_b != BS_CLASS_C)
            bits |= BIT(hetero_bit(class_a, class_b));
        if (aromatic_a && aromatic_b)
            bits |= BIT(50);
        if (!ring)
            bits |= BIT(51);
    } else if (order == 2) {
        bits |= BIT(double_bit(class_a, class_b));
    } else if (order == 3) {
        bits |= class_a == BS_CLASS_N || class_b == BS_CLASS_N ? BIT(44) : BIT(45);
    }
    f.word[1] = bits;
    return f;
}

bs_features bs_feature__counts(const int *classes, int aromatic)
{
    int halogens =
        classes[BS_CLASS_F] + classes[BS_CLASS_CL] + classes[BS_CLASS_BR] + classes[BS_CLASS_I];
    int c = classes[BS_CLASS_C], n = classes[BS_CLASS_N], o = classes[BS_CLASS_O];
    bs_features f = {{0, 0}};

    f.word[1] = (c >= 2 ? BIT(52) : 0) | (c >= 4 ? BIT(53) : 0) | (c >= 7 ? BIT(54) : 0) |
                (n >= 2 ? BIT(55) : 0) | (n >= 3 ? BIT(56) : 0) | (o >= 2 ? BIT(57) : 0) |
                (o >= 3 ? BIT(58) : 0) | (o >= 4 ? BIT(59) : 0) |
                (classes[BS_CLASS_S] >= 2 ? BIT(60) : 0) | (halogens >= 2 ? BIT(61) : 0) |
                (halogens >= 3 ? BIT(62) : 0) | (aromatic >= 7 ? BIT(63) : 0);
    return f;
}

/* ---- The molecule ---------------------------------------------------------------------- */

static void add(bs_features *sum, bs_features more)
{
    sum->word[0] |= more.word[0];
    sum->word[1] |= more.word[1];
}

/*
 * Atoms and bonds that are alike have the same bits, so those of a kind are found once: `seen`
 * keeps the kind that came last at each place.
 */
enum { PLACES = 32 };

typedef struct kind {
    uint64_t word[2]; /* all that the bits depend on; never 0 */
} kind;

static bool is_new(kind *seen, kind k)
{
    kind *at = &seen[(k.word[0] * 0x9E3779B97F4A7C15u ^ k.word[1] * 0xC2B2AE3D27D4EB4Fu) >> 59];

    if (at->word[0] == k.word[0] && at->word[1] == k.word[1])
        return false;
    *at = k;
    return true;
}

static kind atom_kind(bs_atom atom, int hydrogens)
{
    kind k;

    atom.hydrogens = (uint8_t)hydrogens;
    atom.flags &= BS_ATOM_AROMATIC | BS_ATOM_RING;
    atom.isotope = atom.label = 0;
    atom.valence = atom.ring_count = 0;
    atom.perm = 1; /* so that no kind is 0 */
    memcpy(&k, &atom, sizeof k);
    return k;
}

static void add_atom(const bs_mol *mol, uint32_t index, bool has_hydrogens, kind *seen,
                     bs_features *sum)
{
    const bs_atom *atom = &mol->atoms[index];
    bool aromatic = (atom->flags & BS_ATOM_AROMATIC) != 0;
    int class = bs_feature__class(atom->element);
    int hydrogens = has_hydrogens ? bs_mol__total_hydrogens(mol, index) : atom->hydrogens;

    if (!is_new(seen, atom_kind(*atom, hydrogens)))
        return;
    add(sum, bs_feature__atom(class, aromatic));
    add(sum, bs_feature__hydrogens(class, aromatic, hydrogens));
    add(sum, bs_feature__charge(class, (atom->charge > 0) - (atom->charge < 0)));
    add(sum, bs_feature__degree(class, aromatic, atom->degree));
    if (atom->flags & BS_ATOM_RING) {
        add(sum, bs_feature__ring(class, aromatic, atom->min_ring));
        add(sum, bs_feature__ring_bonds(atom->ring_bonds));
    }
    if (atom->stereo == BS_STEREO_TETRAHEDRAL)
        sum->word[0] |= BIT(BS_FEATURE_HAND);
}

static void add_bond(const bs_mol *mol, const bs_bond *bond, kind *seen, bs_features *sum)
{
    const bs_atom *a = &mol->atoms[bond->a], *b = &mol->atoms[bond->b];
    kind k = {{(uint64_t)a->element << 32 | (uint64_t)b->element << 24 |
                   (uint64_t)(a->flags & BS_ATOM_AROMATIC) << 17 |
                   (uint64_t)(b->flags & BS_ATOM_AROMATIC) << 16 | (uint64_t)bond->order << 8 |
                   bond->flags,
               1}};

    if (!is_new(seen, k))
        return;
    add(sum,
        bs_feature__bond(bs_feature__class(a->element), a->flags & BS_ATOM_AROMATIC,
                         bs_feature__class(b->element), b->flags & BS_ATOM_AROMATIC, bond->order,
                         bond->flags & BS_BOND_AROMATIC, bond->flags & BS_BOND_RING));
    if (bond->flags & (BS_BOND_CIS | BS_BOND_TRANS))
        sum->word[0] |= BIT(BS_FEATURE_GEOMETRY);
}

void bs_mol__features(bs_mol *mol)
{
    const bs_bond *bonds = bs_mol__bonds(mol);
    kind seen[PLACES] = {{{0, 0}}};
    int classes[BS_CLASS_COUNT] = {0}, aromatic = 0;
    bs_features sum = {{0, 0}};

    for (uint32_t i = 0; i < mol->atom_count; i++) {
        classes[bs_feature__class(mol->atoms[i].element)]++;
        aromatic += (mol->atoms[i].flags & BS_ATOM_AROMATIC) != 0;
    }
    for (uint32_t i = 0; i < mol->atom_count; i++)
        add_atom(mol, i, classes[BS_CLASS_H] > 0, seen, &sum);
    memset(seen, 0, sizeof seen);
    for (uint32_t i = 0; i < mol->bond_count; i++)
        add_bond(mol, &bonds[i], seen, &sum);
    add(&sum, bs_feature__counts(classes, aromatic));
    memcpy(mol->features, sum.word, sizeof mol->features);
}
