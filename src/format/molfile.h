/*
 * The inside of molfile reading: a table of atoms and bonds as the file has them, which readers of
 * both versions fill and molfile_build.c makes a molecule of.
 */
#ifndef FORMAT_MOLFILE_H
#define FORMAT_MOLFILE_H

#include "backsaw/draft.h"
#include "backsaw/file.h"

/* Stereo of a bond as drawn; the narrow end is the first atom. */
typedef enum bs_bond_mark {
    BS_MARK_NONE,
    BS_MARK_UP,
    BS_MARK_DOWN,
    BS_MARK_EITHER /* a wavy single or a crossed double bond */
} bs_bond_mark;

enum {
    BS_MOLFILE_BOND_AROMATIC = 4,
    BS_MOLFILE_BOND_COORDINATE = 9,
    BS_MOLFILE_BOND_HYDROGEN = 10
};

typedef struct bs_molfile_atom {
    double x, y, z;
    uint8_t element;
    int8_t charge;
    uint16_t isotope;
    uint16_t label;
    uint8_t radical;   /* 0, or 1 singlet, 2 doublet, 3 triplet */
    int16_t valence;   /* stated sum of all bond orders, or -1 */
    int16_t hydrogens; /* stated hydrogens, or -1 */
    uint8_t parity;    /* 1 odd, 2 even */
    bool is_group;     /* written as R#, waits for its number */
    long line;
} bs_molfile_atom;

typedef struct bs_molfile_bond {
    uint32_t a, b;
    uint8_t type;
    uint8_t mark; /* bs_bond_mark */
    long line;
} bs_molfile_bond;

/* A stereo group with atoms of the table, before the molecule is there. */
typedef struct bs_molfile_group {
    bs_stereo_group_kind kind;
    int number;
    uint32_t count;
    uint32_t *atoms;
} bs_molfile_group;

typedef struct bs_molfile {
    bs_ctx *cx;
    bs_arena *temp; /* of the arrays */
    bs_molfile_atom *atoms;
    bs_molfile_bond *bonds;
    uint32_t atom_count, bond_count;
    bs_molfile_group *groups;
    uint32_t group_count, group_room;
    bool chiral;
    const char *name;
    size_t name_length;
} bs_molfile;

/* ---- Lines ----------------------------------------------------------------------------- */

/* A text that is read line by line. `line` is the number of the line in `at`, 0 before the first.
 */
typedef struct bs_scan {
    bs_ctx *cx;
    const char *text;
    size_t length;
    size_t next; /* where the line behind begins */
    long line;   /* of the file, 1-based */
    const char *at;
    size_t size;
} bs_scan;

void bs_scan__begin(bs_scan *scan, bs_ctx *cx, const char *text, size_t length, long first_line);

/* Goes to the next line; false at the end of the text. */
bool bs_scan__line(bs_scan *scan);

/* The same where a line must come; `what` names it. BS_ESYNTAX at the end of the text. */
bs_status bs_scan__need_line(bs_scan *scan, const char *what);

/*
 * Fails with "line 5, columns 31 to 34: ..." (columns 0-based, `width` of them; none named if it
 * is 0), error.line and error.offset set.
 */
bs_status bs_scan__fail(const bs_scan *scan, bs_status code, size_t column, size_t width,
                        const char *format, ...) __attribute__((format(printf, 5, 6)));

/* Fails for an atom or bond that was read earlier: "line 5: ...". */
bs_status bs_scan__fail_line(bs_ctx *cx, long line, bs_status code, const char *format, ...)
    __attribute__((format(printf, 4, 5)));

/*
 * A whole number in a fixed column; blank is 0. `what` says in the message what it is, such as
 * "the number of atoms".
 */
bs_status bs_scan__column(const bs_scan *scan, size_t column, size_t width, long low, long high,
                          const char *what, long *out);

/* Whether the line starts with `text`. */
bool bs_scan__starts(const bs_scan *scan, const char *text);

/* Reads a whole number or a decimal that fills the text; false if it is none or out of range. */
bool bs_scan__long(const char *text, size_t length, long low, long high, long *out);
bool bs_scan__double(const char *text, size_t length, double *out);

/* ---- Parts of a molfile ---------------------------------------------------------------- */

#define BS_MOLFILE_PLACE_MAX 1e6 /* largest coordinate that is taken for one */

/*
 * The element of an atom symbol; sets what the symbol says beyond it (isotope of D and T, group
 * number of R1). False if the symbol is no atom of a molecule.
 */
bool bs_molfile__symbol(const char *text, size_t length, bs_molfile_atom *atom);

/* What a refused symbol is, for the message: "a query atom", "a lone pair", "no element". */
const char *bs_molfile__symbol_trouble(const char *text, size_t length);

/* Checks a bond type; the message names what a refused one is. */
bs_status bs_molfile__check_type(const bs_scan *scan, size_t column, size_t width, long type);

/* Make room for the arrays. */
bs_status bs_molfile__reserve(bs_molfile *file, uint32_t atoms, uint32_t bonds);

/* Reads the blocks behind the counts line up to `M  END`. */
bs_status bs_molfile__read_v2000(bs_molfile *file, bs_scan *scan);
bs_status bs_molfile__read_v3000(bs_molfile *file, bs_scan *scan);

/* Reads a whole molfile into the table; `scan` stands before its first line. */
bs_status bs_molfile__read(bs_molfile *file, bs_scan *scan);

/* Makes the molecule and fills mol, name, groups and chiral of `record`. */
bs_status bs_molfile__build(const bs_molfile *file, bs_arena *home, bs_record *record);

/* Adds the stereo elements that the drawing shows. Atoms of the draft are those of the table. */
bs_status bs_molfile__add_stereo(const bs_molfile *file, bs_draft *draft);

#endif
