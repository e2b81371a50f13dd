/* The SQLite file of a catalogue: schema, writing, opening and lookup. */
#include "catalogue/store.h"

#include "backsaw/format.h"
#include "core/map.h"

#include <errno.h>
#include <math.h>
#include <stdio.h>
#include <string.h>
#include <sys/stat.h>

#define TABLE_SQL                                                                                  \
    "CREATE TABLE offer (id INTEGER PRIMARY KEY, key INTEGER NOT NULL, smiles TEXT NOT NULL, "     \
    "code TEXT, name TEXT, price_per_gram REAL, container_g REAL, lead_days REAL)"
#define INDEX_SQL "CREATE INDEX offer_by_key ON offer (key)"

struct bs_catalogue {
    bs_gate *gate;
    size_t bytes;
    sqlite3 *db;
    sqlite3_stmt *find;
    long count;
    char path[];
};

static sqlite3_int64 key_of(const char *smiles)
{
    uint64_t hash = bs_hash_bytes(smiles, strlen(smiles), 0);
    sqlite3_int64 key;

    memcpy(&key, &hash, sizeof key);
    return key;
}

/* ---- Shared ---------------------------------------------------------------------------- */

bs_status bs_store__path(bs_ctx *cx, bs_arena *home, const char *path, char **out)
{
    size_t room = strlen(path) + 3;
    bs_status st = bs_new(cx, home, room, out);

    if (st == BS_OK)
        snprintf(*out, room, "%s%s", *path == '/' ? "" : "./", path);
    return st;
}

bs_status bs_store__fail(bs_ctx *cx, sqlite3 *db, const char *path, const char *doing)
{
    switch (sqlite3_errcode(db)) {
    case SQLITE_NOMEM:
        return bs_fail_memory(cx);
    case SQLITE_INTERRUPT:
        return bs_fail(cx, BS_ESTOPPED, "stopped");
    default:
        return bs_fail(cx, BS_EFILE, "cannot %s the catalogue '%.200s': %.100s", doing, path,
                       sqlite3_errmsg(db));
    }
}

static int stop_asked(void *payload)
{
    const bs_ctx *cx = payload;

    return atomic_load_explicit(cx->stop, memory_order_relaxed);
}

/* ---- Writing --------------------------------------------------------------------------- */

static bs_status run(bs_ctx *cx, bs_store_writer *writer, const char *sql)
{
    bs_status st;

    sqlite3_progress_handler(writer->db, 10000, stop_asked, cx);
    st = sqlite3_exec(writer->db, sql, NULL, NULL, NULL) == SQLITE_OK
             ? BS_OK
             : bs_store__fail(cx, writer->db, writer->path, "write");
    sqlite3_progress_handler(writer->db, 0, NULL, NULL);
    return st;
}

bs_status bs_store__begin(bs_ctx *cx, const char *path, const char *shown, bs_store_writer *out)
{
    char setup[200];
    bs_status st;

    *out = (bs_store_writer){.path = shown};
    if (sqlite3_open_v2(path, &out->db, SQLITE_OPEN_READWRITE | SQLITE_OPEN_NOMUTEX, NULL) !=
        SQLITE_OK)
        return out->db ? bs_store__fail(cx, out->db, shown, "write") : bs_fail_memory(cx);
    /* The file is thrown away if anything fails, so SQLite needs no journal of its own. */
    sqlite3_snprintf(sizeof setup, setup,
                     "PRAGMA journal_mode = OFF; PRAGMA synchronous = OFF; "
                     "PRAGMA application_id = %d; PRAGMA user_version = %d; BEGIN",
                     BS_STORE_APPLICATION, BS_STORE_VERSION);
    if ((st = run(cx, out, setup)) != BS_OK || (st = run(cx, out, TABLE_SQL)) != BS_OK)
        return st;
    if (sqlite3_prepare_v2(out->db,
                           "INSERT INTO offer (key, smiles, code, name, price_per_gram, "
                           "container_g, lead_days) VALUES (?, ?, ?, ?, ?, ?, ?)",
                           -1, &out->insert, NULL) != SQLITE_OK)
        return bs_store__fail(cx, out->db, shown, "write");
    return BS_OK;
}

static void bind_number(sqlite3_stmt *statement, int column, double value)
{
    if (value >= 0)
        sqlite3_bind_double(statement, column, value);
    else
        sqlite3_bind_null(statement, column);
}

bs_status bs_store__add(bs_ctx *cx, bs_store_writer *writer, const bs_offer *offer)
{
    sqlite3_stmt *s = writer->insert;
    int code;

    sqlite3_bind_int64(s, 1, key_of(offer->smiles));
    sqlite3_bind_text(s, 2, offer->smiles, -1, SQLITE_STATIC);
    sqlite3_bind_text(s, 3, offer->code, -1, SQLITE_STATIC);
    sqlite3_bind_text(s, 4, offer->name, -1, SQLITE_STATIC);
    bind_number(s, 5, offer->price_per_gram);
    bind_number(s, 6, offer->container_g);
    bind_number(s, 7, offer->lead_days);
    code = sqlite3_step(s);
    sqlite3_reset(s);
    sqlite3_clear_bindings(s);
    return code == SQLITE_DONE ? BS_OK : bs_store__fail(cx, writer->db, writer->path, "write");
}

bs_status bs_store__commit(bs_ctx *cx, bs_store_writer *writer)
{
    bs_status st = run(cx, writer, INDEX_SQL);

    return st == BS_OK ? run(cx, writer, "COMMIT") : st;
}

void bs_store__close(bs_store_writer *writer)
{
    sqlite3_finalize(writer->insert);
    sqlite3_close(writer->db);
    *writer = (bs_store_writer){0};
}

/* ---- Opening --------------------------------------------------------------------------- */

/* The integer that a statement answers with; -1 if it fails. */
static sqlite3_int64 ask(sqlite3 *db, const char *sql)
{
    sqlite3_stmt *s = NULL;
    sqlite3_int64 answer = -1;

    if (sqlite3_prepare_v2(db, sql, -1, &s, NULL) == SQLITE_OK && sqlite3_step(s) == SQLITE_ROW)
        answer = sqlite3_column_int64(s, 0);
    sqlite3_finalize(s);
    return answer;
}

/* Opens a file for reading and looks at its mark. The file may come from a stranger. */
static bs_status open_file(bs_ctx *cx, const char *path, sqlite3 **db)
{
    bs_mark temp = bs_arena_mark(&cx->scratch);
    struct stat info;
    char *name;
    bs_status st = BS_OK;

    *db = NULL;
    if (stat(path, &info) != 0)
        return bs_fail(cx, BS_EFILE, "cannot open '%.200s': %s", path, strerror(errno));
    if (!S_ISREG(info.st_mode))
        return bs_fail(cx, BS_EFILE, "'%.200s' is not a regular file", path);
    if ((st = bs_store__path(cx, &cx->scratch, path, &name)) != BS_OK)
        return st;
    if (sqlite3_open_v2(name, db, SQLITE_OPEN_READONLY | SQLITE_OPEN_NOMUTEX, NULL) != SQLITE_OK) {
        st = *db ? bs_store__fail(cx, *db, path, "open") : bs_fail_memory(cx);
        goto done;
    }
    sqlite3_limit(*db, SQLITE_LIMIT_LENGTH, 8 * 1024 * 1024);
    sqlite3_db_config(*db, SQLITE_DBCONFIG_DEFENSIVE, 1, NULL);
    sqlite3_db_config(*db, SQLITE_DBCONFIG_TRUSTED_SCHEMA, 0, NULL);
    if (ask(*db, "PRAGMA application_id") != BS_STORE_APPLICATION)
        st = bs_fail(cx, BS_EFILE,
                     "'%.200s' is no catalogue; catalogues are built from lists of compounds", path);
done:
    bs_arena_rewind(&cx->scratch, temp);
    if (st != BS_OK) {
        sqlite3_close(*db);
        *db = NULL;
    }
    return st;
}

bs_status bs_store__is_catalogue(bs_ctx *cx, const char *path)
{
    sqlite3 *db;
    bs_status st = open_file(cx, path, &db);

    sqlite3_close(db);
    return st;
}

/* Our own two statements and nothing else: no view or trigger of a stranger's is ever run. */
static bs_status check_schema(bs_ctx *cx, sqlite3 *db, const char *path)
{
    sqlite3_int64 version = ask(db, "PRAGMA user_version");

    if (version != BS_STORE_VERSION)
        return bs_fail(cx, BS_EFILE,
                       "the catalogue '%.200s' has format %lld, this program reads format %d; build "
                       "it again",
                       path, (long long)version, BS_STORE_VERSION);
    if (ask(db, "SELECT count(*) = 2 AND sum(sql = '" TABLE_SQL "') = 1 AND sum(sql = '" INDEX_SQL
                "') = 1 FROM sqlite_schema") != 1)
        return bs_fail(cx, BS_EFILE,
                       "the catalogue '%.200s' is damaged: its tables are not those of a catalogue",
                       path);
    return BS_OK;
}

/* Whether a stored SMILES is what this program takes for canonical. */
static bs_status is_canonical(bs_ctx *cx, const char *smiles, bool *same)
{
    bs_mark temp = bs_arena_mark(&cx->scratch);
    bs_mol *mol;
    char *text;
    bs_status st = bs_smiles_read(cx, &cx->scratch, smiles, strlen(smiles), NULL, &mol);

    if (st == BS_OK)
        st = bs_smiles_canonical(cx, &cx->scratch, mol, 0, &text);
    *same = st == BS_OK && strcmp(text, smiles) == 0;
    bs_arena_rewind(&cx->scratch, temp);
    return st == BS_ENOMEM || st == BS_ESTOPPED ? st : BS_OK;
}

/*
 * A catalogue whose canonical form is another one would silently find nothing. A few rows spread
 * over the file tell.
 */
static bs_status check_sample(bs_ctx *cx, bs_catalogue *catalogue)
{
    sqlite3_stmt *s = NULL;
    bool same = true;
    bs_status st = BS_OK;

    if (sqlite3_prepare_v2(catalogue->db, "SELECT smiles FROM offer WHERE id = ?", -1, &s, NULL) !=
        SQLITE_OK)
        return bs_store__fail(cx, catalogue->db, catalogue->path, "read");
    for (int k = 0; k <= 16 && same && st == BS_OK; k++) {
        sqlite3_bind_int64(s, 1, 1 + (sqlite3_int64)((double)(catalogue->count - 1) * k / 16));
        if (sqlite3_step(s) == SQLITE_ROW) {
            const char *smiles = (const char *)sqlite3_column_text(s, 0);

            st = is_canonical(cx, smiles ? smiles : "", &same);
        }
        sqlite3_reset(s);
    }
    sqlite3_finalize(s);
    if (st == BS_OK && !same)
        st = bs_fail(cx, BS_EFILE,
                     "the catalogue '%.200s' was built by another version, which writes SMILES "
                     "differently; build it again",
                     catalogue->path);
    return st;
}

/* Fills a catalogue whose path is set. A read transaction stays open: it saves locks. */
static bs_status fill_catalogue(bs_ctx *cx, bs_catalogue *catalogue)
{
    sqlite3_int64 count;
    bs_status st = open_file(cx, catalogue->path, &catalogue->db);

    if (st != BS_OK)
        return st;
    if (sqlite3_exec(catalogue->db, "BEGIN", NULL, NULL, NULL) != SQLITE_OK)
        return bs_store__fail(cx, catalogue->db, catalogue->path, "read");
    if ((st = check_schema(cx, catalogue->db, catalogue->path)) != BS_OK)
        return st;
    /* Rows are numbered from 1 and none is ever taken out. */
    count = ask(catalogue->db, "SELECT coalesce(max(id), 0) FROM offer");
    if (count < 0)
        return bs_store__fail(cx, catalogue->db, catalogue->path, "read");
    catalogue->count = (long)count;
    if (sqlite3_prepare_v3(catalogue->db,
                           "SELECT code, name, price_per_gram, container_g, lead_days FROM offer "
                           "WHERE key = ?1 AND smiles = ?2 ORDER BY price_per_gram IS NULL, "
                           "price_per_gram, id LIMIT ?3",
                           -1, SQLITE_PREPARE_PERSISTENT, &catalogue->find, NULL) != SQLITE_OK)
        return bs_store__fail(cx, catalogue->db, catalogue->path, "read");
    return check_sample(cx, catalogue);
}

bs_status bs_catalogue_open(bs_ctx *cx, const char *path, bs_catalogue **out)
{
    size_t bytes = sizeof **out + strlen(path) + 1;
    bs_catalogue *catalogue = bs_gate_alloc(cx->gate, bytes);
    bs_status st;

    *out = NULL;
    if (!catalogue)
        return bs_fail_memory(cx);
    catalogue->gate = cx->gate;
    catalogue->bytes = bytes;
    memcpy(catalogue->path, path, bytes - sizeof *catalogue);
    if ((st = fill_catalogue(cx, catalogue)) != BS_OK) {
        bs_catalogue_close(catalogue);
        return st;
    }
    *out = catalogue;
    return BS_OK;
}

void bs_catalogue_close(bs_catalogue *catalogue)
{
    if (!catalogue)
        return;
    sqlite3_finalize(catalogue->find);
    sqlite3_close(catalogue->db);
    bs_gate_free(catalogue->gate, catalogue, catalogue->bytes);
}

long bs_catalogue_count(const bs_catalogue *catalogue)
{
    return catalogue->count;
}

/* ---- Lookup ---------------------------------------------------------------------------- */

static bs_status copy_column(bs_ctx *cx, bs_arena *home, sqlite3_stmt *s, int column,
                             const char **out)
{
    const char *text = (const char *)sqlite3_column_text(s, column);
    char *copy;
    bs_status st;

    *out = NULL;
    if (!text)
        return BS_OK;
    if ((st = bs_copy_text(cx, home, text, strlen(text), &copy)) == BS_OK)
        *out = copy;
    return st;
}

static double number_column(sqlite3_stmt *s, int column)
{
    double value = -1;

    if (sqlite3_column_type(s, column) != SQLITE_NULL)
        value = sqlite3_column_double(s, column);
    return isfinite(value) && value >= 0 ? value : -1;
}

static bs_status read_offer(bs_ctx *cx, bs_arena *home, sqlite3_stmt *s, const char *smiles,
                            bs_offer *out)
{
    bs_status st;

    *out = (bs_offer){.smiles = smiles, .ground = "identity"};
    if ((st = copy_column(cx, home, s, 0, &out->code)) != BS_OK ||
        (st = copy_column(cx, home, s, 1, &out->name)) != BS_OK)
        return st;
    out->price_per_gram = number_column(s, 2);
    out->container_g = number_column(s, 3);
    out->lead_days = number_column(s, 4);
    return BS_OK;
}

/* Copies the rows of the bound statement; the list lies in scratch until its length is known. */
static bs_status read_offers(bs_ctx *cx, bs_arena *home, bs_catalogue *catalogue,
                             const char *smiles, int limit, bs_offers *out)
{
    sqlite3_stmt *s = catalogue->find;
    bs_offer *found;
    char *copy = NULL;
    int code = SQLITE_DONE;
    bs_status st = bs_new(cx, &cx->scratch, limit, &found);

    while (st == BS_OK && (code = sqlite3_step(s)) == SQLITE_ROW && out->count < limit) {
        if (out->count == 0)
            st = bs_copy_text(cx, home, smiles, strlen(smiles), &copy);
        if (st == BS_OK)
            st = read_offer(cx, home, s, copy, &found[out->count++]);
    }
    if (st == BS_OK && code != SQLITE_DONE && code != SQLITE_ROW)
        st = bs_store__fail(cx, catalogue->db, catalogue->path, "read");
    if (st == BS_OK && (st = bs_new(cx, home, out->count, &out->items)) == BS_OK)
        memcpy(out->items, found, (size_t)out->count * sizeof *found);
    return st;
}

bs_status bs_store__find(bs_ctx *cx, bs_arena *home, bs_catalogue *catalogue, const char *smiles,
                         int limit, bs_offers *out)
{
    bs_mark temp = bs_arena_mark(&cx->scratch), kept = bs_arena_mark(home);
    bs_status st;

    *out = (bs_offers){0};
    sqlite3_bind_int64(catalogue->find, 1, key_of(smiles));
    sqlite3_bind_text(catalogue->find, 2, smiles, -1, SQLITE_STATIC);
    sqlite3_bind_int(catalogue->find, 3, limit);
    st = read_offers(cx, home, catalogue, smiles, limit, out);
    sqlite3_reset(catalogue->find);
    sqlite3_clear_bindings(catalogue->find);
    if (home != &cx->scratch)
        bs_arena_rewind(&cx->scratch, temp);
    if (st != BS_OK) {
        bs_arena_rewind(home, kept);
        *out = (bs_offers){0};
    }
    return st;
}

bs_status bs_catalogue_find(bs_ctx *cx, bs_arena *home, bs_catalogue *catalogue, const bs_mol *mol,
                            bs_offers *out)
{
    bs_mark temp = bs_arena_mark(&cx->scratch);
    char *smiles;
    bs_status st = bs_smiles_canonical(cx, &cx->scratch, mol, 0, &smiles);

    *out = (bs_offers){0};
    if (st == BS_OK)
        st = bs_store__find(cx, home, catalogue, smiles, BS_STORE_OFFERS, out);
    if (home != &cx->scratch || st != BS_OK)
        bs_arena_rewind(&cx->scratch, temp);
    return st;
}
