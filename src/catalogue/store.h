/*
 * The SQLite file of a catalogue.
 *
 * One table of offers, indexed by a 64-bit hash of the canonical SMILES; the string is compared on
 * a hit. `application_id` marks the file as ours, `user_version` is BS_STORE_VERSION. A file is
 * written once and never changed afterwards.
 */
#ifndef CATALOGUE_STORE_H
#define CATALOGUE_STORE_H

#include "backsaw/catalogue.h"

#include <sqlite3.h>

#define BS_STORE_APPLICATION 0x62736177 /* "bsaw" */
#define BS_STORE_VERSION 1

/* A compound has more offers than this in no honest catalogue; the dearest are left out. */
#define BS_STORE_OFFERS 1000

/* The path as SQLite shall read it: none of the names that mean something else to it. */
bs_status bs_store__path(bs_ctx *cx, bs_arena *home, const char *path, char **out);

/* Reports what SQLite says about `path` as BS_EFILE; BS_ENOMEM and BS_ESTOPPED where it is so. */
bs_status bs_store__fail(bs_ctx *cx, sqlite3 *db, const char *path, const char *doing);

/* A new catalogue that is being written, all in one transaction. */
typedef struct bs_store_writer {
    sqlite3 *db;
    sqlite3_stmt *insert;
    const char *path;
} bs_store_writer;

/*
 * Begins a catalogue in the empty file at `path`; messages call it `shown`. Close the writer
 * whatever this returns.
 */
bs_status bs_store__begin(bs_ctx *cx, const char *path, const char *shown, bs_store_writer *out);
bs_status bs_store__add(bs_ctx *cx, bs_store_writer *writer, const bs_offer *offer);

/* Makes the index and commits. */
bs_status bs_store__commit(bs_ctx *cx, bs_store_writer *writer);
void bs_store__close(bs_store_writer *writer);

/* BS_OK if the file at `path` is a catalogue of any version, else BS_EFILE. */
bs_status bs_store__is_catalogue(bs_ctx *cx, const char *path);

/* At most `limit` offers by canonical SMILES, the cheapest per gram first. */
bs_status bs_store__find(bs_ctx *cx, bs_arena *home, bs_catalogue *catalogue, const char *smiles,
                         int limit, bs_offers *out);

#endif
