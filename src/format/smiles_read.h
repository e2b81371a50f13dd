/* The inside of the SMILES reader. */
#ifndef FORMAT_SMILES_READ_H
#define FORMAT_SMILES_READ_H

#include "backsaw/format.h"
#include "chem/draft.h"

enum { SMILES_RINGS = 100 };

/* What stands beside a draft atom while reading. */
typedef struct smiles_atom {
    uint32_t at;  /* where its symbol or bracket starts */
    uint8_t kind; /* BS_STEREO_... if it has a mark; SMILES_BARE_MARK for @ and @@ */
    uint8_t perm;
} smiles_atom;

enum { SMILES_BARE_MARK = 100 };

/*
 * What stands beside a draft bond. `place_a` says where in the text the bond's other end is named
 * beside its atom a; 0 for the atom that stands before it. `mark` is '/' or '\\' as written from a
 * to b, or 0.
 */
typedef struct smiles_bond {
    uint32_t place_a, place_b;
    char mark;
} smiles_bond;

typedef struct smiles_ring {
    uint32_t atom; /* draft atom + 1; 0 if the number is free */
    uint32_t at;   /* of the digit */
    char symbol;   /* of the bond, or 0 */
} smiles_ring;

typedef struct smiles_branch {
    uint32_t atom;
    uint32_t at;
} smiles_branch;

typedef struct smiles_reader {
    bs_ctx *cx;
    const char *text;
    uint32_t length;
    uint32_t at;
    bs_draft draft;
    smiles_atom *atoms;
    smiles_bond *bonds;
    smiles_branch *branches;
    uint32_t depth;
    uint32_t last; /* the atom that the next one is bonded to, or UINT32_MAX */
    char symbol;   /* bond symbol read, or 0 */
    uint32_t symbol_at;
    bool has_marks;  /* any @ */
    bool has_slants; /* any / or \ */
    smiles_ring rings[SMILES_RINGS];
} smiles_reader;

/* Reads the bracket atom at which the reader stands. */
bs_status smiles_read_bracket(smiles_reader *r, bs_draft_atom *atom, smiles_atom *beside);

/* Adds the stereo elements that the marks of the whole string make. */
bs_status smiles_read_stereo(smiles_reader *r);

/* Reports what was found where something else was expected. */
bs_status smiles_unexpected(smiles_reader *r, uint32_t at, const char *expected);

#endif
