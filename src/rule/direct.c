/* Estimates of where arenes are attacked. */
#include "backsaw/direct.h"

#include <math.h>

#include "chem/mol.h"
#include "rule/substituent.h"

enum { MAX_SYSTEM = 60, MAX_SWEEPS = 60 };

/* Slopes: a unit of localisation energy, a unit of a substituent's constant. */
static const double LOCAL_SLOPE = 11, ELECTROPHILE_SLOPE = -6.5, NUCLEOPHILE_SLOPE = 4.5;

/* Localisation energy of benzene, in units of the resonance integral. */
static const double BENZENE = 2.5359;

/* The aromatic system of an atom as Hückel's method sees it. */
typedef struct system {
    const bs_mol *mol;
    int atoms[MAX_SYSTEM], count;
    int electrons;
    double h[MAX_SYSTEM], k[MAX_SYSTEM]; /* of heteroatoms; k is 1 for carbon */
} system;

/* ---- The system --------------------------------------------------------------------------------
 */

static int find(const system *s, int atom)
{
    for (int i = 0; i < s->count; i++) {
        if (s->atoms[i] == atom)
            return i;
    }
    return -1;
}

/* The aromatic atoms that hang together with `atom`, and oxygens on their double bonds. */
static bs_status collect(bs_ctx *cx, system *s, int atom)
{
    s->atoms[s->count++] = atom;
    for (int i = 0; i < s->count; i++) {
        for (int n = 0; n < bs_mol_atom_degree(s->mol, s->atoms[i]); n++) {
            int other, bond;

            bs_mol_neighbour(s->mol, s->atoms[i], n, &other, &bond);
            if (find(s, other) >= 0 || !bs_mol_atom_is_aromatic(s->mol, s->atoms[i]))
                continue;
            if (!bs_mol_bond_is_aromatic(s->mol, bond) &&
                (bs_mol_bond_order(s->mol, bond) < 2 || bs_mol_atom_element(s->mol, other) == 6))
                continue;
            if (s->count == MAX_SYSTEM)
                return bs_fail(cx, BS_ELIMIT, "the aromatic system has more than %d atoms",
                               MAX_SYSTEM);
            s->atoms[s->count++] = other;
        }
    }
    return BS_OK;
}

static bool is_basic(const bs_mol *mol, int atom)
{
    return bs_mol_atom_element(mol, atom) == 7 && bs_mol_atom_is_aromatic(mol, atom) &&
           bs_mol_atom_charge(mol, atom) == 0 &&
           bs_mol_atom_degree(mol, atom) + bs_mol_atom_hydrogens(mol, atom) == 2;
}

static bool share_ring(const bs_mol *mol, int a, int b)
{
    for (int r = 0; r < bs_mol_ring_count(mol); r++) {
        const uint32_t *atoms;
        int size = bs_mol_ring(mol, r, &atoms);
        bool has_a = false, has_b = false;

        for (int i = 0; i < size; i++) {
            has_a = has_a || (int)atoms[i] == a;
            has_b = has_b || (int)atoms[i] == b;
        }
        if (has_a && has_b)
            return true;
    }
    return false;
}

/* Whether an azole nitrogen can hand its hydrogen on, or take it: it has a partner in its ring. */
static bool is_shifting(const bs_mol *mol, int atom)
{
    bool hydrogen = bs_mol_atom_hydrogens(mol, atom) > 0;

    if (bs_mol_atom_element(mol, atom) != 7 || bs_mol_atom_charge(mol, atom) != 0)
        return false;
    for (int r = 0; r < bs_mol_ring_count(mol); r++) {
        const uint32_t *atoms;
        int size = bs_mol_ring(mol, r, &atoms);
        bool here = false, partner = false;

        for (int i = 0; i < size; i++) {
            here = here || (int)atoms[i] == atom;
            partner = partner || (hydrogen ? is_basic(mol, (int)atoms[i])
                                           : bs_mol_atom_element(mol, (int)atoms[i]) == 7 &&
                                                 bs_mol_atom_hydrogens(mol, (int)atoms[i]) > 0);
        }
        if (size == 5 && here && partner)
            return true;
    }
    return false;
}

/* Whether a positive atom bears a negative oxygen, which makes up for the charge. */
static bool is_oxide(const bs_mol *mol, int atom)
{
    for (int n = 0; n < bs_mol_atom_degree(mol, atom); n++) {
        int other;

        bs_mol_neighbour(mol, atom, n, &other, NULL);
        if (bs_mol_atom_element(mol, other) == 8 && bs_mol_atom_charge(mol, other) < 0)
            return true;
    }
    return false;
}

/* Parameters of a heteroatom (Streitwieser 1961, from memory; sulfur as nitrogen with a lone pair).
 */
static int set_parameters(system *s, int i)
{
    int atom = s->atoms[i], element = bs_mol_atom_element(s->mol, atom);
    int charge = bs_mol_atom_charge(s->mol, atom);
    int bonds = bs_mol_atom_degree(s->mol, atom) + bs_mol_atom_hydrogens(s->mol, atom);

    s->h[i] = 0;
    s->k[i] = 1;
    if (!bs_mol_atom_is_aromatic(s->mol, atom)) {
        s->h[i] = 1;
        return 1;
    }
    if (element == 6)
        return charge < 0 ? 2 : charge > 0 ? 0 : 1;
    if (is_shifting(s->mol, atom)) {
        s->h[i] = 1.35;
        s->k[i] = 0.95;
        return bonds == 2 ? 1 : 2;
    }
    if (element == 7 && (bonds == 2 || charge > 0)) {
        s->h[i] = is_oxide(s->mol, atom) ? 0 : charge > 0 ? 0.8 : 0.5;
        return charge < 0 ? 2 : 1;
    }
    s->h[i] = element == 8 ? 2 : 1.5;
    s->k[i] = element == 8 ? 0.8 : 0.9;
    return 2;
}

static double resonance(const system *s, int i, int k)
{
    int bond = bs_mol_bond_between(s->mol, s->atoms[i], s->atoms[k]);

    return bond < 0 ? 0 : fmin(s->k[i], s->k[k]);
}

/* ---- Hückel's method
 * ------------------------------------------------------------------------------ */

/* Jacobi's method on a symmetric matrix of n rows; `vectors` gets its eigenvectors as columns. */
static void diagonalise(double *m, double *vectors, int n)
{
    for (int i = 0; i < n * n; i++)
        vectors[i] = i % (n + 1) == 0;
    for (int sweep = 0; sweep < MAX_SWEEPS; sweep++) {
        double off = 0;

        for (int p = 0; p < n; p++) {
            for (int q = p + 1; q < n; q++) {
                double apq = m[p * n + q], theta, t, c, s;

                off += fabs(apq);
                if (fabs(apq) < 1e-12)
                    continue;
                theta = (m[q * n + q] - m[p * n + p]) / (2 * apq);
                t = (theta >= 0 ? 1 : -1) / (fabs(theta) + sqrt(theta * theta + 1));
                c = 1 / sqrt(t * t + 1);
                s = t * c;
                for (int k = 0; k < n; k++) {
                    double kp = m[k * n + p], kq = m[k * n + q];

                    m[k * n + p] = c * kp - s * kq;
                    m[k * n + q] = s * kp + c * kq;
                }
                for (int k = 0; k < n; k++) {
                    double pk = m[p * n + k], qk = m[q * n + k];
                    double vp = vectors[k * n + p], vq = vectors[k * n + q];

                    m[p * n + k] = c * pk - s * qk;
                    m[q * n + k] = s * pk + c * qk;
                    vectors[k * n + p] = c * vp - s * vq;
                    vectors[k * n + q] = s * vp + c * vq;
                }
            }
        }
        if (off < 1e-9)
            return;
    }
}

/* Electrons fill the highest eigenvalues (the resonance integral is negative); returns the energy.
 */
static double fill(const double *m, const double *vectors, int n, int electrons, double *population)
{
    bool taken[MAX_SYSTEM] = {false};
    double energy = 0;

    for (int i = 0; i < n; i++)
        population[i] = 0;
    while (electrons > 0) {
        int best = -1, here = electrons < 2 ? electrons : 2;

        for (int i = 0; i < n; i++) {
            if (!taken[i] && (best < 0 || m[i * n + i] > m[best * n + best] + 1e-9))
                best = i;
        }
        if (best < 0)
            break;
        taken[best] = true;
        energy += here * m[best * n + best];
        for (int i = 0; i < n; i++)
            population[i] += here * vectors[i * n + best] * vectors[i * n + best];
        electrons -= here;
    }
    return energy;
}

/* Energy of the system without atom number `out` (-1: with all), and populations by system number.
 */
static bs_status solve(bs_ctx *cx, const system *s, int out, int electrons, double *energy,
                       double *population)
{
    bs_mark temp = bs_arena_mark(&cx->scratch);
    int kept[MAX_SYSTEM], n = 0;
    double *m, *vectors, filled[MAX_SYSTEM];
    bs_status st;

    for (int i = 0; i < s->count; i++) {
        population[i] = 0;
        if (i != out)
            kept[n++] = i;
    }
    if ((st = bs_new(cx, &cx->scratch, n * n + 1, &m)) != BS_OK ||
        (st = bs_new(cx, &cx->scratch, n * n + 1, &vectors)) != BS_OK)
        return st;
    for (int i = 0; i < n; i++) {
        for (int k = 0; k < n; k++)
            m[i * n + k] = i == k ? s->h[kept[i]] : resonance(s, kept[i], kept[k]);
    }
    diagonalise(m, vectors, n);
    *energy = fill(m, vectors, n, electrons, filled);
    for (int i = 0; i < n; i++)
        population[kept[i]] = filled[i];
    bs_arena_rewind(&cx->scratch, temp);
    return BS_OK;
}

/* ---- Substituents and hindrance
 * --------------------------------------------------------------------- */

static bool in_system(const system *s, int atom)
{
    return find(s, atom) >= 0;
}

/* The sum over all substituents but the skipped one; `charge` as left by the attack. */
static double substituents(const system *s, int attacked, int skip, bs_attack attack,
                           const double *charge)
{
    double sum = 0;

    for (int i = 0; i < s->count; i++) {
        double weight = fmax(0, fmin(0.6, charge[i])) * 3;

        if (!bs_mol_atom_is_aromatic(s->mol, s->atoms[i]) || i == attacked)
            continue;
        for (int n = 0; n < bs_mol_atom_degree(s->mol, s->atoms[i]); n++) {
            bs_group_constants c;
            int other;

            bs_mol_neighbour(s->mol, s->atoms[i], n, &other, NULL);
            if (in_system(s, other) || other == skip)
                continue;
            c = bs_substituent__constants(s->mol, s->atoms[i], other, attack);
            sum += c.meta + (c.para - c.meta) * weight;
        }
    }
    return sum;
}

/* Hindrance by the groups on the neighbours, by peri hydrogens, in bays and between two groups. */
static double hindrance(const system *s, int attacked, int skip, double bulk)
{
    int beside = 0, atom = s->atoms[attacked];
    double sum = 0;

    for (int n = 0; n < bs_mol_atom_degree(s->mol, atom); n++) {
        double most = 0;
        int next, other;

        bs_mol_neighbour(s->mol, atom, n, &next, NULL);
        if (next == skip || !in_system(s, next))
            continue;
        for (int k = 0; k < bs_mol_atom_degree(s->mol, next); k++) {
            bs_mol_neighbour(s->mol, next, k, &other, NULL);
            if (other == atom || other == skip)
                continue;
            if (!in_system(s, other))
                most = fmax(most, bs_substituent__size(s->mol, next, other));
            else if (!share_ring(s->mol, other, atom))
                most = fmax(most, bs_mol_atom_degree(s->mol, other) > 2     ? 0.8
                                  : bs_mol_atom_element(s->mol, other) == 6 ? 0.1
                                                                            : 1.2);
        }
        beside += most > 0.15;
        sum += most;
    }
    return (sum + (beside == 2 ? 0.9 : 0)) * bulk;
}

/* ---- What Hückel's method does not see
 * ------------------------------------------------------------ */

/* Electrophiles come with acid: a basic nitrogen is protonated; what that costs the attacked place.
 */
static double protonate(system *s, int i)
{
    if (!is_basic(s->mol, s->atoms[i]))
        return 0;
    if (!is_shifting(s->mol, s->atoms[i]))
        s->h[i] = 1.2;
    return share_ring(s->mol, s->atoms[i], s->atoms[0]) ? -5 : -2;
}

/* The atom with a lone pair in a ring of five, or -1; `*fused` tells whether another ring shares a
 * bond. */
static int rich_atom(const bs_mol *mol, const uint32_t *atoms, int size, bool *fused)
{
    int hetero = -1;

    *fused = false;
    for (int i = 0; i < size && size == 5; i++) {
        int element = bs_mol_atom_element(mol, (int)atoms[i]);

        *fused = *fused || mol->atoms[atoms[i]].ring_count > 1;
        if (element == 8 || element == 16 || (element == 7 && !is_basic(mol, (int)atoms[i])))
            hetero = (int)atoms[i];
    }
    return hetero;
}

/*
 * Rings of five with a lone pair: pyrrole before furan before thiophene, and in their benzo
 * derivatives the place away from nitrogen and sulfur.
 */
static double rich_ring(const system *s)
{
    const bs_mol *mol = s->mol;

    for (int r = 0; r < bs_mol_ring_count(mol); r++) {
        const uint32_t *atoms;
        int size = bs_mol_ring(mol, r, &atoms), hetero;
        bool here = false, fused;
        double away;

        for (int i = 0; i < size; i++)
            here = here || (int)atoms[i] == s->atoms[0];
        hetero = here ? rich_atom(mol, atoms, size, &fused) : -1;
        if (hetero < 0)
            continue;
        away = fused && bs_mol_bond_between(mol, hetero, s->atoms[0]) < 0 ? 1 : 0;
        switch (bs_mol_atom_element(mol, hetero)) {
        case 7:
            return 3 + away;
        case 8:
            return -1;
        default:
            return -2 + away;
        }
    }
    return 0;
}

/* A carbon between two nitrogens is attacked less readily by nucleophiles than it should be. */
static double between_nitrogens(const system *s)
{
    int count = 0;

    for (int n = 0; n < bs_mol_atom_degree(s->mol, s->atoms[0]); n++) {
        int other;

        bs_mol_neighbour(s->mol, s->atoms[0], n, &other, NULL);
        count += is_basic(s->mol, other);
    }
    return count == 2 ? -0.6 : 0;
}

/* ---- Together
 * ---------------------------------------------------------------------------------------- */

bs_status bs_arene_rate(bs_ctx *cx, const bs_mol *mol, int atom, int skip, bs_attack attack,
                        double bulk, double *rate)
{
    system s = {.mol = mol};
    double whole, rest, population[MAX_SYSTEM], charge[MAX_SYSTEM], slope;
    int lost = attack == BS_BY_ELECTROPHILE ? 2 : 0;
    bs_status st;

    if (!bs_mol_atom_is_aromatic(mol, atom) || bs_mol_atom_element(mol, atom) != 6)
        return bs_fail(cx, BS_EVALUE, "atom %d is no aromatic carbon", atom + 1);
    if ((st = collect(cx, &s, atom)) != BS_OK)
        return st;
    *rate = 0;
    for (int i = 0; i < s.count; i++) {
        s.electrons += set_parameters(&s, i);
        *rate += attack == BS_BY_ELECTROPHILE ? protonate(&s, i) : 0;
    }
    *rate += attack == BS_BY_ELECTROPHILE ? rich_ring(&s) : between_nitrogens(&s);
    if ((st = solve(cx, &s, -1, s.electrons, &whole, population)) != BS_OK ||
        (st = solve(cx, &s, 0, s.electrons - lost, &rest, population)) != BS_OK)
        return st;
    for (int i = 0; i < s.count; i++)
        charge[i] = attack == BS_BY_ELECTROPHILE ? 1 - population[i] : population[i] - 1;
    slope = attack == BS_BY_ELECTROPHILE ? ELECTROPHILE_SLOPE : NUCLEOPHILE_SLOPE;
    *rate += LOCAL_SLOPE * (BENZENE - (whole - rest));
    *rate += slope * substituents(&s, 0, skip, attack, charge);
    *rate -= hindrance(&s, 0, skip, bulk);
    return BS_OK;
}
