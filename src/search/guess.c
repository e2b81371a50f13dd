/*
 * The default guess for a molecule that is not explored: how many steps it may take to make it.
 *
 * No published scale is used. What sellers offer is small and flat, so each heavy atom beyond a
 * few, each ring beyond the first, each stereocentre and each hetero atom beyond two adds a part
 * of a step. The constant taken off makes two halves cheaper than the whole, so a disconnection
 * in the middle looks better than a nibble at the rim, and an interconversion, which changes
 * little, has to pay for itself.
 */
#include "backsaw/search.h"

#include <math.h>

#define MOST_STEPS 40.0

double bs_guess_steps(const bs_mol *mol)
{
    int heavy = 0, hetero = 0, stereo = 0, rings = bs_mol_ring_count(mol);
    double steps;

    for (int i = 0; i < bs_mol_atom_count(mol); i++) {
        int element = bs_mol_atom_element(mol, i);

        heavy += element != 1;
        hetero += element != 1 && element != 6;
        stereo += bs_mol_atom_hand(mol, i) != BS_HAND_NONE;
    }
    for (int i = 0; i < bs_mol_bond_count(mol); i++)
        stereo += bs_mol_bond_geometry(mol, i) != BS_GEOMETRY_NONE;
    steps = (heavy - 6) / 4.0 + 0.5 * (rings - 1) + 0.75 * stereo + 0.25 * (hetero - 2);
    return fmin(MOST_STEPS, fmax(0, steps));
}
