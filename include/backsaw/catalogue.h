/*
 * Catalogues: what can be had. A catalogue is one SQLite file of offers, keyed by canonical
 * SMILES; a list is the same in memory. A shelf is a list of both in order of preference, and is
 * what the search asks.
 */
#ifndef BACKSAW_CATALOGUE_H
#define BACKSAW_CATALOGUE_H

#include "backsaw/mol.h"

typedef struct bs_catalogue bs_catalogue;

/* One line of a catalogue. Strings are NULL, numbers negative where the source says nothing. */
typedef struct bs_offer {
    const char *code;
    const char *name;
    const char *smiles; /* canonical */
    double price_per_gram; /* € per g */
    double container_g;
    double lead_days;
    const char *ground; /* how it was found: "identity" so far */
} bs_offer;

typedef struct bs_offers {
    bs_offer *items;
    int count;
} bs_offers;

/* What an import did: lines read, offers kept, and the first lines that were refused. */
typedef struct bs_import_report {
    long lines, offers, refused;
    long first_refused_line; /* 0 if none */
    char first_refused[BS_MESSAGE_MAX]; /* with the names of file and line */
} bs_import_report;

/*
 * Builds a catalogue file from lists: .smi (SMILES, blank, name), .tsv, .csv with a header line
 * that names its columns (smiles; code, name, price_per_gram[_eur], pack_g or container_g,
 * lead_days, all but smiles optional, in any order and case, others ignored), each also with .gz.
 * In a .csv fields may be quoted as in RFC 4180, and semicolons or tabs may stand for the commas;
 * a .tsv knows no quotes. An .sdf has the structure in place of the smiles column and data fields
 * in place of the others. The file is written beside `output` and renamed into place, so a failure
 * leaves an older one whole; a file that is there and is no catalogue is not overwritten.
 *
 *   A line that is no use is counted in the report and left out: its SMILES cannot be read or
 *   weighed or has more than 16 KiB, a number is none, there are too many fields or more than
 *   1 MiB.
 *
 *   errors  BS_EFILE   an input that cannot be read, an output that cannot be written
 *           BS_ESYNTAX no header with a smiles column, an unclosed quote; error.line is set
 *           BS_EVALUE  not one line could be used
 *           BS_ELIMIT  one input has more than 4 GiB of text
 *           BS_ESTOPPED
 *   The report is filled up to the error.
 */
bs_status bs_catalogue_build(bs_ctx *cx, const char *const *inputs, int input_count,
                             const char *output, bs_import_report *report);

/*
 * Opens a catalogue file for reading. Several may be open; one thread at a time uses each.
 *
 *   errors  BS_EFILE  not there, no catalogue, damaged, or written by a version whose format or
 *                     canonical SMILES differ
 */
bs_status bs_catalogue_open(bs_ctx *cx, const char *path, bs_catalogue **out);

/* NULL is allowed. */
void bs_catalogue_close(bs_catalogue *catalogue);

/* Number of offers. */
long bs_catalogue_count(const bs_catalogue *catalogue);

/*
 * Offers for a molecule, the cheapest per gram first, those without price last; no offer is BS_OK
 * with count 0. At most 1000 are given.
 */
bs_status bs_catalogue_find(bs_ctx *cx, bs_arena *home, bs_catalogue *catalogue, const bs_mol *mol,
                            bs_offers *out);

/* ---- Shelf ----------------------------------------------------------------------------- */

typedef struct bs_shelf bs_shelf;

bs_status bs_shelf_new(bs_ctx *cx, bs_shelf **out);

/* Frees the shelf; its catalogues stay open. */
void bs_shelf_free(bs_shelf *shelf);

/* Puts a catalogue behind the sources that are there. It must outlive the shelf. */
bs_status bs_shelf_add_catalogue(bs_ctx *cx, bs_shelf *shelf, bs_catalogue *catalogue);

/*
 * Puts one compound into list number `list` of the shelf at a price in € per mole; put twice, it
 * costs the lower price. Lists and catalogues are asked in the order in which they were begun;
 * bs_shelf_add_list() begins one.
 *
 *   errors  BS_ERANGE  no such list, or a price that is negative or no number
 */
bs_status bs_shelf_add_list(bs_ctx *cx, bs_shelf *shelf, int *list);
bs_status bs_shelf_put(bs_ctx *cx, bs_shelf *shelf, int list, const bs_mol *mol, double per_mole);

/* Puts a compound that is free and always at hand, if no source prices it. */
bs_status bs_shelf_at_hand(bs_ctx *cx, bs_shelf *shelf, const bs_mol *mol);

/* Whether the shelf holds lists only, which bs_shelf_listed() names in full. */
bool bs_shelf_is_listed(const bs_shelf *shelf);

/*
 * The canonical SMILES of what is in lists or at hand, in the order in which it was put there,
 * counted from 0; NULL behind the last. It lives as long as the shelf.
 */
const char *bs_shelf_listed(const bs_shelf *shelf, size_t at);

/*
 * Price of a molecule in € per mole from the first source that has it, the price per gram times
 * the molar mass; an offer without price counts as 1 € per mole. What is at hand, and any
 * molecule without carbon and unknown atoms, is free if no source prices it. `found` is false if
 * it cannot be had; `offer` (or NULL) is filled, with strings in `home`, for an offer of a
 * catalogue; else its smiles is NULL. `smiles` is the canonical SMILES of `mol`.
 */
bs_status bs_shelf_price(bs_ctx *cx, bs_arena *home, bs_shelf *shelf, const bs_mol *mol,
                         const char *smiles, bool *found, double *per_mole, bs_offer *offer);

#endif
