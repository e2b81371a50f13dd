/*
 * Guesses for a molecule that is not explored: how many steps it may take to make it.
 *
 * No published scale is used. What sellers offer is small and flat, so each heavy atom beyond a
 * few, each ring beyond the first and each stereo mark adds a part of a step. The constant taken
 * off makes two halves cheaper than the whole, so a disconnection in the middle looks better than
 * a nibble at the rim, and an interconversion, which changes little, has to pay for itself. Hetero
 * atoms were tried and left out: with them protected intermediates came too late.
 *
 * Where the whole shelf is a short list, it can be looked at from the other side. A step changes
 * the surroundings of a few atoms; an atom that stands as no atom of the shelf does has a step
 * before it. The weights are those that found the published syntheses of the check data with the
 * fewest expansions.
 */
#include "search/guess.h"

#include "backsaw/format.h"

#include <math.h>
#include <string.h>

#define MOST_STEPS 40.0
#define LISTED_MOST 200
#define STEPS_BY_ATOM (1 / 3.0)
#define SIZE_SHARE 0.3
#define SURROUNDINGS_SEED 0x73757272u

double bs_guess_steps(const bs_mol *mol)
{
    int heavy = 0, stereo = 0, rings = bs_mol_ring_count(mol);

    for (int i = 0; i < bs_mol_atom_count(mol); i++) {
        heavy += bs_mol_atom_element(mol, i) != 1;
        stereo += bs_mol_atom_hand(mol, i) != BS_HAND_NONE;
    }
    for (int i = 0; i < bs_mol_bond_count(mol); i++)
        stereo += bs_mol_bond_geometry(mol, i) != BS_GEOMETRY_NONE;
    return fmin(MOST_STEPS, fmax(0, (heavy - 6) / 4.0 + 0.5 * (rings - 1) + 0.75 * stereo));
}

/* ---- Surroundings ----------------------------------------------------------------------------- */

static uint64_t describe(const bs_mol *mol, int atom)
{
    uint64_t hash = bs_hash_mix(SURROUNDINGS_SEED, (uint64_t)bs_mol_atom_element(mol, atom));

    return bs_hash_mix(hash, (uint64_t)bs_mol_atom_hydrogens(mol, atom));
}

/* A hash of an atom and its neighbours; that of the neighbours is a sum, so order does not show. */
static uint64_t surroundings(const bs_mol *mol, int atom)
{
    uint64_t hash = describe(mol, atom), sum = 0;

    hash = bs_hash_mix(hash, (uint64_t)bs_mol_atom_charge(mol, atom) + 64);
    hash = bs_hash_mix(hash, bs_mol_atom_is_aromatic(mol, atom));
    for (int k = 0; k < bs_mol_atom_degree(mol, atom); k++) {
        uint64_t next;
        int other, bond;

        bs_mol_neighbour(mol, atom, k, &other, &bond);
        next = bs_hash_mix(describe(mol, other), (uint64_t)bs_mol_atom_degree(mol, other));
        next = bs_hash_mix(next, bs_mol_bond_is_aromatic(mol, bond)
                                     ? 5
                                     : (uint64_t)bs_mol_bond_order(mol, bond));
        sum += next;
    }
    return bs_hash_mix(hash, sum);
}

static bool is_listed(const bs_guess *guess, uint64_t hash)
{
    size_t cursor = 0;

    return bs_map_next(&guess->listed, hash, &cursor) != BS_MAP_NONE;
}

static bs_status add_listed(bs_guess *guess, bs_ctx *cx, const char *smiles)
{
    bs_arena home;
    bs_mol *mol;
    bs_status st;

    bs_arena_init(&home, cx->gate);
    st = bs_smiles_read(cx, &home, smiles, strlen(smiles), NULL, &mol);
    for (int i = 0; st == BS_OK && i < bs_mol_atom_count(mol); i++) {
        uint64_t hash = surroundings(mol, i);

        if (!is_listed(guess, hash))
            st = bs_map_add(&guess->listed, hash, 0);
    }
    bs_arena_free(&home);
    return st;
}

/* ---- Guesses ---------------------------------------------------------------------------------- */

bs_status bs_guess__init(bs_guess *guess, bs_ctx *cx, const bs_shelf *shelf)
{
    const char *smiles;
    bs_status st = BS_OK;

    bs_map_init(&guess->listed, cx);
    guess->by_list = shelf && bs_shelf_is_listed(shelf) && bs_shelf_listed(shelf, 0) &&
                     !bs_shelf_listed(shelf, LISTED_MOST);
    for (size_t i = 0; guess->by_list && st == BS_OK && (smiles = bs_shelf_listed(shelf, i)); i++)
        st = add_listed(guess, cx, smiles);
    return st;
}

void bs_guess__free(bs_guess *guess)
{
    if (guess->listed.cx)
        bs_map_free(&guess->listed);
}

double bs_guess__steps(const bs_guess *guess, const bs_mol *mol)
{
    double steps = bs_guess_steps(mol);
    int strange = 0;

    if (!guess->by_list)
        return steps;
    for (int i = 0; i < bs_mol_atom_count(mol); i++)
        strange += !is_listed(guess, surroundings(mol, i));
    return fmin(MOST_STEPS, STEPS_BY_ATOM * strange + SIZE_SHARE * steps);
}
