/*
 * Files of molecules: molfiles (V2000 and V3000), SD files and lists of SMILES, in and out.
 *
 * Reading streams: a file is opened, gives one record after the other, and is closed; memory does
 * not grow with the length of the file. Gzip files are read as they are. Names and data fields
 * are UTF-8; text that is no UTF-8 is taken for Latin-1 and turned into it.
 *
 * Molfiles follow the CTfile formats. Differences and decisions:
 * - Hydrogens that are not drawn follow the valences of SMILES; metals carry none. A stated
 *   valence or hydrogen count holds; radicals have fewer hydrogens.
 * - Bonds of type 4 are aromatic, 9 is a coordinate bond (order 0), 10 (a hydrogen bond) is left
 *   out. Atom lists, query atoms and query bonds are refused: a molecule is no pattern.
 * - R groups and `*`, `A` become the unknown atom; the number of an R group and an atom-atom
 *   mapping number become the label.
 * - Stereo comes from wedges (narrow end at the centre) and places if the record is flat, from
 *   places if it has depth, from parities if it has no places. A wavy bond, contradicting wedges
 *   and crossed double bonds say that nothing is known. Without a collection of stereo groups
 *   every centre is as drawn, whatever the chiral flag says.
 */
#ifndef BACKSAW_FILE_H
#define BACKSAW_FILE_H

#include "backsaw/mol.h"

/* A data field of an SD record. Both texts end in a NUL behind their length. */
typedef struct bs_field {
    const char *name;
    size_t name_length;
    const char *value; /* lines are joined by \n */
    size_t value_length;
} bs_field;

typedef enum bs_stereo_group_kind {
    BS_STEREO_GROUP_ABSOLUTE, /* as drawn */
    BS_STEREO_GROUP_RELATIVE, /* as drawn or all the other way round, one of the two (STEREL) */
    BS_STEREO_GROUP_RACEMIC   /* a mixture of both (STERAC) */
} bs_stereo_group_kind;

/* Centres whose configurations hang together, from a V3000 collection. */
typedef struct bs_stereo_group {
    bs_stereo_group_kind kind;
    int number; /* STEREL1 and STERAC1 have 1; 0 for absolute */
    int atom_count;
    const int *atoms; /* of the molecule */
} bs_stereo_group;

typedef struct bs_record {
    const bs_mol *mol;
    const char *name; /* without the blanks around it; may be empty */
    size_t name_length;
    const bs_field *fields;
    int field_count;
    const bs_stereo_group *groups;
    int group_count;
    bool chiral; /* the chiral flag of a molfile */
    long number; /* of the record, 1-based */
    long line;   /* of the file, where the record begins */
} bs_record;

/* ---- Reading files --------------------------------------------------------------------- */

typedef enum bs_file_kind {
    BS_FILE_BY_NAME, /* .sdf .sd .mol .mdl or .smi .smiles .ism .txt, each also with .gz */
    BS_FILE_SDF,     /* also a single molfile */
    BS_FILE_SMILES   /* a SMILES, blank, a name; # starts a comment line */
} bs_file_kind;

/* The zero value is the default. */
typedef struct bs_file_options {
    bs_file_kind kind;
    size_t line_limit;   /* bytes of the longest line; 0 for 1 MiB */
    size_t record_limit; /* bytes of the longest record; 0 for 64 MiB */
} bs_file_options;

typedef struct bs_file bs_file;

/*
 * Opens a file of molecules; the context is used until it is closed.
 *
 *   options  may be NULL
 *   errors   BS_EFILE    cannot be opened
 *            BS_EVALUE   the name does not tell the kind
 *            BS_ENOMEM
 */
bs_status bs_file_open(bs_ctx *cx, const char *path, const bs_file_options *options, bs_file **out);

/*
 * Reads the next record; *out is NULL at the end of the file.
 *
 *   home    arena of the record and its molecule; rewind it for constant memory
 *   errors  BS_ESYNTAX, BS_EVALUE, BS_ELIMIT  the record cannot be read; error.line is the line of
 *                      the file, and the message says where and what was expected
 *           BS_EFILE   the file cannot be read on
 *           BS_ELIMIT  a line or record that is too long, or a gzip file that expands out of all
 *                      proportion
 *           BS_ESTOPPED, BS_ENOMEM
 *
 * After an error bs_file_can_go_on() tells whether the next call finds the record behind the bad
 * one; else it fails again.
 */
bs_status bs_file_next(bs_file *file, bs_arena *home, bs_record **out);
bool bs_file_can_go_on(const bs_file *file);

/* The number of the record that was read or refused last, 1-based; and the line where it begins. */
long bs_file_record_number(const bs_file *file);
long bs_file_record_line(const bs_file *file);

/* Closes; NULL is allowed. */
void bs_file_close(bs_file *file);

/* ---- Writing files --------------------------------------------------------------------- */

typedef struct bs_file_writer bs_file_writer;

/*
 * Begins a file of molecules; its name tells the kind as for reading. The file is there under its
 * name, in place of one that was, once bs_file_finish() has given BS_OK. The context is used until
 * then.
 *
 *   errors   BS_EFILE    cannot be written
 *            BS_EVALUE   the name does not tell the kind
 *            BS_ENOMEM
 */
bs_status bs_file_create(bs_ctx *cx, const char *path, bs_file_writer **out);

/*
 * Writes a record. Of a list of SMILES molecule and name count, labels are written; of other files
 * what bs_sdf_write() takes. After an error the file is as before the record, save BS_EFILE.
 *
 *   lost    if not NULL, gets the number of stereo elements that a molfile cannot hold
 */
bs_status bs_file_put(bs_file_writer *writer, const bs_record *record, int *lost);

/* Puts the file in its place; the writer is gone, with BS_EFILE as well. */
bs_status bs_file_finish(bs_file_writer *writer);

/* Removes what was written; NULL is allowed. */
void bs_file_abandon(bs_file_writer *writer);

/* ---- Molfiles in memory ---------------------------------------------------------------- */

/*
 * Reads a molfile, V2000 or V3000; what follows `M  END` is left out.
 *
 *   errors  BS_ESYNTAX, BS_EVALUE  with the line in error.line and the byte in error.offset
 *           BS_ELIMIT              more atoms or bonds than fit
 *           BS_ENOMEM
 */
bs_status bs_molfile_read(bs_ctx *cx, bs_arena *home, const char *text, size_t length,
                          bs_record **out);

typedef enum bs_molfile_version {
    BS_MOLFILE_AUTO, /* V2000 where it can hold the molecule, else V3000 */
    BS_MOLFILE_V2000,
    BS_MOLFILE_V3000
} bs_molfile_version;

/*
 * Writes a molfile with a flat drawing; bonds are 1.5 long. Line breaks in the name become blanks.
 * No date is written: equal molecules in equal order give equal bytes.
 *
 *   lost    if not NULL, gets the number of stereo elements that a molfile cannot hold
 *   errors  BS_EVALUE  a quadruple bond; V2000 was asked for and cannot hold the molecule (more
 *                      than 999 atoms or bonds, labels above 999, charges beyond 15, coordinate
 *                      bonds)
 *           and those of bs_layout_make(). On an error `out` is as before
 */
bs_status bs_molfile_write(bs_text *out, const bs_mol *mol, const char *name,
                           bs_molfile_version version, int *lost);

/*
 * Writes a record of an SD file: molfile, data fields, `$$$$`. Of `record` the molecule, the name,
 * the fields and the stereo groups count; relative and racemic groups need V3000. Blank lines in values, which would end them, get a blank; `<` and `>`
 * in field names become brackets.
 */
bs_status bs_sdf_write(bs_text *out, const bs_record *record, bs_molfile_version version,
                       int *lost);

#endif
