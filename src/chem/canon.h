/*
 * Canonical order and symmetry: what the files canon*.c, symmetry.c and stereo_symmetry.c share.
 *
 * The search works on a plain graph (`bs_canon_graph`) made of one connected piece of a molecule.
 * All that distinguishes atoms without regard to their neighbours is in one 64-bit key each;
 * bonds have a type, and aromatic ones share a type, so Kekulé orders never matter there. Stereo
 * elements tell the hand of their ligands; the code of an element under a colouring of the atoms
 * is the mark it would have if its ligands were listed by colour, and 0 as long as two of them
 * have the same colour.
 *
 * `bs_canon_cells` is an ordered partition of the atoms into cells. The colour of an atom is the
 * place where its cell starts, so that in a discrete partition the colour is the rank. Refinement
 * (colour refinement with a worklist; Hopcroft 1971, McKay 1981, Paige & Tarjan 1987) splits cells
 * until all atoms of a cell have the same numbers of neighbours of each bond type in every cell,
 * and the same codes of stereo elements. Splits are logged and can be undone.
 *
 * The search (McKay, "Practical graph isomorphism", 1981) individualises one atom of a cell after
 * the other and keeps the leaf with the smallest trace and certificate.
 */
#ifndef CHEM_CANON_H
#define CHEM_CANON_H

#include "chem/mol.h"

#define BS_CANON_NONE UINT32_MAX /* no atom; as a ligand: implied hydrogen or lone pair */
#define BS_CANON_LONE_PAIR (UINT32_MAX - 1) /* as a ligand beside an implied hydrogen */

enum {
    BS_CANON_DOUBLE = 6, /* kind of a cis or trans double bond, beside BS_STEREO_... */
    BS_CANON_AROMATIC = 5,
    BS_CANON_TYPE_BITS = 3
};

/*
 * A stereo element. The ligands of an allene or double bond are two at site or end 0, then two at
 * the other; `perm` of a double bond is 1 if ligands 0 and 2 are cis, 2 if trans. A removed
 * element has perm 0.
 */
typedef struct bs_canon_element {
    uint8_t kind;
    uint8_t perm;
    uint8_t ligand_count;
    uint8_t site_count;
    uint32_t source; /* atom or bond of the molecule that carries the mark */
    uint32_t site[2];
    uint32_t ligand[6];
} bs_canon_element;

typedef struct bs_canon_graph {
    const bs_mol *mol;
    const uint32_t *atoms; /* atom of the molecule for each atom of the graph */
    uint32_t atom_count;
    uint32_t edge_count;    /* ends of bonds: twice the bonds */
    const uint32_t *offset; /* atom_count + 1 */
    const uint32_t *edge;   /* neighbour << BS_CANON_TYPE_BITS | bond type */
    uint64_t *key;
    uint32_t *number; /* each atom its own number: the colouring in which all differ */
    bs_canon_element *element;
    uint32_t element_count;
    uint32_t *element_head; /* for each atom: first link, or BS_CANON_NONE */
    uint32_t *element_next; /* links 2 * element + site index */
    bool labelled;          /* labels (atom classes) tell atoms apart */
} bs_canon_graph;

static inline bool bs_canon__is_atom(uint32_t ligand)
{
    return ligand < BS_CANON_LONE_PAIR;
}

/* The connected pieces: piece k has atoms[start[k]] to atoms[start[k + 1] - 1], ascending. */
typedef struct bs_canon_pieces {
    uint32_t count;
    uint32_t *start;
    uint32_t *atoms;
    uint32_t *local; /* place of each atom within its piece */
} bs_canon_pieces;

/* Finds the connected pieces. Arrays are in the scratch arena. */
bs_status bs_canon__pieces(bs_ctx *cx, const bs_mol *mol, bs_canon_pieces *pieces);

/* Builds the graph of one piece in the scratch arena. */
bs_status bs_canon__graph(bs_ctx *cx, const bs_mol *mol, const bs_canon_pieces *pieces,
                          uint32_t piece, bs_canon_graph *graph);

/* Sets the keys; with `marked` the presence of stereo elements is part of them. */
void bs_canon__set_keys(bs_canon_graph *graph, bool marked);

/* The label of an atom if the graph is labelled, else 0. */
uint32_t bs_canon__label(const bs_canon_graph *graph, uint32_t atom);

/*
 * Reads the stereo element of an atom, or of a bond, of the molecule. Ligands are atoms of the
 * molecule. Answers false, with perm 0, if there is no mark or it cannot mean anything: too few
 * ligands, or two implied ones.
 */
bool bs_canon__atom_element(const bs_mol *mol, uint32_t atom, bs_canon_element *element);
bool bs_canon__bond_element(const bs_mol *mol, uint32_t bond, bs_canon_element *element);

/* Code of an element under a colouring; 0 if two ligands share a colour. */
uint32_t bs_canon__code(const bs_canon_element *element, const uint32_t *colour);

/*
 * Adds the codes under a colouring to `sum` of the element's sites, in a field for each kind.
 * Answers whether the code is not 0.
 */
bool bs_canon__add_code(const bs_canon_element *element, const uint32_t *colour, uint64_t *sum);

/* ---- Cells ----------------------------------------------------------------------------- */

typedef struct bs_canon_cells {
    uint32_t atom_count;
    uint32_t cell_count;
    uint32_t *lab;    /* atoms, cell after cell */
    uint32_t *place;  /* where an atom stands in lab */
    uint32_t *colour; /* start of the atom's cell */
    uint32_t *size;   /* by start */
    uint32_t *split;  /* starts made, in order; the log of splits */
    uint32_t split_count;
    uint32_t *queue; /* ring of cells still to be used as splitters */
    uint32_t queue_head;
    uint32_t queue_count;
    uint8_t *queued; /* by start */
    uint64_t *sum;   /* by atom; all 0 between calls */
    uint32_t *hit;   /* cells met by a splitter */
    uint32_t hit_count;
    uint32_t *hits; /* by start; all 0 between calls */
    uint32_t *members;
    uint64_t trace; /* hash of what refinement did; the same for alike atoms */
    uint64_t work;  /* bond ends looked at, for the bound */
} bs_canon_cells;

/* Makes room in the scratch arena for a partition of `atom_count` atoms. */
bs_status bs_canon__cells_new(bs_ctx *cx, uint32_t atom_count, bs_canon_cells *cells);

/* Sorts the atoms into cells by key and label; all cells wait to be used as splitters. */
void bs_canon__cells_start(bs_canon_cells *cells, const bs_canon_graph *graph);

/* Splits cells until the partition is equitable. */
void bs_canon__refine(bs_canon_cells *cells, const bs_canon_graph *graph);

/* Gives an atom a cell of its own at the end of its cell; refinement is to follow. */
void bs_canon__single_out(bs_canon_cells *cells, uint32_t atom);

/*
 * Gives the sites of an element a cell of their own, together if they shared one. For use between
 * bs_canon__cells_start() and the first refinement.
 */
void bs_canon__set_apart(bs_canon_cells *cells, const bs_canon_element *element);

/* Undoes all splits after the first `split_count`. */
void bs_canon__undo(bs_canon_cells *cells, uint32_t split_count);

/* Sorts `count` items ascending by key[item], or by themselves if `key` is NULL. */
void bs_canon__sort(uint32_t *items, uint32_t count, const uint64_t *key);

/* ---- Exchanging two atoms -------------------------------------------------------------- */

/* An automorphism that exchanges pairs of atoms. `image` is BS_CANON_NONE for atoms not met. */
typedef struct bs_canon_swap {
    uint32_t *image;
    uint32_t *met; /* atoms with an image: moved and fixed ones */
    uint32_t met_count;
    uint64_t work;
} bs_canon_swap;

bs_status bs_canon__swap_new(bs_ctx *cx, uint32_t atom_count, bs_canon_swap *swap);

/* Forgets the images. */
void bs_canon__swap_clear(bs_canon_swap *swap);

/*
 * Tries to find an automorphism that exchanges `v` and `w` and keeps all that was singled out
 * before. `before` is the colouring refined after singling out v, `after` that for w. True is a
 * proof (every bond and stereo element was compared); false says nothing. Clear afterwards.
 */
bool bs_canon__swap_find(bs_canon_swap *swap, const bs_canon_graph *graph, const uint32_t *before,
                         const uint32_t *after, uint32_t v, uint32_t w);

/* ---- Search ---------------------------------------------------------------------------- */

typedef struct bs_canon_order {
    uint32_t *rank;        /* by atom of the graph */
    uint32_t *certificate; /* equal for equal graphs; NULL unless asked for */
    size_t certificate_length;
    uint32_t *orbit; /* by atom: an atom that stands for its orbit; NULL unless asked for */
    uint64_t work;   /* bond ends looked at */
} bs_canon_order;

typedef struct bs_canon_task {
    bool certificate;
    bool orbits;
    const uint32_t *fixed; /* stereo elements that keep their places, each by itself */
    uint32_t fixed_count;
    uint64_t work_limit; /* 0 for the usual one */
} bs_canon_task;

/*
 * Finds the canonical order of a graph whose keys are set. Results are in the scratch arena.
 *
 *   errors  BS_ELIMIT, BS_ESTOPPED, BS_ENOMEM
 */
bs_status bs_canon__search(bs_ctx *cx, const bs_canon_graph *graph, const bs_canon_task *task,
                           bs_canon_order *out);

/* Compares certificates as words: negative, 0 or positive. */
int bs_canon__compare(const bs_canon_order *a, const bs_canon_order *b);

/*
 * bs_mol_canonical_order(), where with `labelled` the labels tell atoms apart that are alike
 * without them.
 */
bs_status bs_mol__order(bs_ctx *cx, bs_arena *home, const bs_mol *mol, bool labelled, int **rank);

/* ---- Stereo marks ---------------------------------------------------------------------- */

/*
 * Removes the marks of stereo elements that mean nothing from a block that is being finished:
 * their ligands are too few or alike, so that the element turned over is the same molecule. Ring
 * members that only mean something together (cis and trans) are kept.
 *
 *   cost  nothing without marks; one refinement for the common case
 */
bs_status bs_mol__strip_meaningless_stereo(bs_ctx *cx, bs_mol *mol);

#endif
