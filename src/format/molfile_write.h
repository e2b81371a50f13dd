/* What the writers of both versions of the molfile format share. */
#ifndef FORMAT_MOLFILE_WRITE_H
#define FORMAT_MOLFILE_WRITE_H

#include "backsaw/file.h"
#include "backsaw/layout.h"
#include "chem/mol.h"

#define BS_MOLFILE_SCALE 1.5 /* length of a bond */

/* A molecule with its drawing; drawn hydrogens are atoms behind the others. */
typedef struct bs_molfile_out {
    bs_text *out;
    const bs_mol *mol;
    const bs_layout *layout;
    uint8_t *drawn; /* by atom: drawn hydrogens */
    uint32_t atom_count, bond_count;
    bool chiral;
    const bs_stereo_group *groups;
    int group_count;
} bs_molfile_out;

typedef struct bs_molfile_out_bond {
    uint32_t a, b; /* a is the narrow end */
    int order;     /* 0 to 3 */
    bs_wedge wedge;
    bool undecided;
} bs_molfile_out_bond;

/* Bond `i` of those that are written. */
bs_molfile_out_bond bs_molfile__out_bond(const bs_molfile_out *o, uint32_t i);

/* The place of atom `i` of those that are written. */
bs_point bs_molfile__out_place(const bs_molfile_out *o, uint32_t i);

/*
 * The valence to state for an atom: -1 where readers find its hydrogens without, else the sum of
 * its bond orders with hydrogens.
 */
int bs_molfile__out_valence(const bs_molfile_out *o, uint32_t atom);

/* 2 for an atom with one unpaired electron, else 0. */
int bs_molfile__out_radical(const bs_molfile_out *o, uint32_t atom);

/* Write what comes behind the three lines of the header. */
bs_status bs_molfile__write_v2000(const bs_molfile_out *o);
bs_status bs_molfile__write_v3000(const bs_molfile_out *o);

#endif
