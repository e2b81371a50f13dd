/*
 * Building a catalogue from lists. The new file is written beside the output and takes its name
 * only when it is whole and on disk.
 */
#include "catalogue/row.h"
#include "catalogue/store.h"

#include "backsaw/format.h"

#include <errno.h>
#include <fcntl.h>
#include <stdio.h>
#include <stdlib.h>
#include <string.h>
#include <sys/stat.h>
#include <unistd.h>

/* No compound that is sold is larger. */
#define SMILES_BYTES ((size_t)16 * 1024)
#define MOL_ATOMS 10000

/* ---- One row --------------------------------------------------------------------------- */

/* Length of the well-formed UTF-8 character at `text` (RFC 3629), or 0. */
static size_t utf8_length(const unsigned char *text, size_t length)
{
    size_t n = *text < 0x80   ? 1
               : *text < 0xC2 ? 0
               : *text < 0xE0 ? 2
               : *text < 0xF0 ? 3
               : *text < 0xF5 ? 4
                              : 0;

    if (n > length)
        return 0;
    for (size_t i = 1; i < n; i++) {
        if ((text[i] & 0xC0) != 0x80)
            return 0;
    }
    if ((*text == 0xE0 && text[1] < 0xA0) || (*text == 0xED && text[1] > 0x9F) ||
        (*text == 0xF0 && text[1] < 0x90) || (*text == 0xF4 && text[1] > 0x8F))
        return 0;
    return n;
}

/* A copy as clean UTF-8: a byte that is none becomes U+FFFD. NULL for an empty text. */
static bs_status copy_clean(bs_ctx *cx, bs_arena *home, bs_slice slice, const char **out)
{
    const unsigned char *text = (const unsigned char *)slice.text;
    char *copy;
    size_t used = 0;
    bs_status st;

    *out = NULL;
    if (slice.length == 0)
        return BS_OK;
    if ((st = bs_new(cx, home, 3 * slice.length + 1, &copy)) != BS_OK)
        return st;
    for (size_t i = 0; i < slice.length;) {
        size_t n = utf8_length(text + i, slice.length - i);

        memcpy(copy + used, n ? slice.text + i : "\xEF\xBF\xBD", n ? n : 3);
        used += n ? n : 3;
        i += n ? n : 1;
    }
    *out = copy;
    return BS_OK;
}

/* The molecule of a row, from its SMILES in scratch where the list has none. */
static bs_status read_mol(bs_ctx *cx, const bs_row *row, const bs_mol **out)
{
    bs_mol *mol;
    size_t used;
    bs_status st;

    if (row->fault)
        return bs_fail(cx, BS_EVALUE, "%s", row->fault);
    *out = row->mol;
    if (row->mol)
        return BS_OK;
    if (row->smiles.length > SMILES_BYTES)
        return bs_fail(cx, BS_ELIMIT, "a SMILES of %zu bytes; at most %zu are read",
                       row->smiles.length, SMILES_BYTES);
    st = bs_smiles_read(cx, &cx->scratch, row->smiles.text, row->smiles.length, &used, &mol);
    if (st != BS_OK)
        return st;
    if (used < row->smiles.length)
        return bs_fail_at(cx, BS_ESYNTAX, used, "text behind the SMILES");
    *out = mol;
    return BS_OK;
}

/*
 * Fills an offer from a row, in scratch. A row that is no use gives BS_EVALUE, BS_ESYNTAX or
 * BS_ELIMIT; other errors end the import.
 */
static bs_status read_offer(bs_ctx *cx, const bs_row *row, bs_offer *out)
{
    const bs_mol *mol;
    char *smiles;
    double mass;
    bs_status st = read_mol(cx, row, &mol);

    if (st != BS_OK)
        return st;
    if (bs_mol_atom_count(mol) == 0)
        return bs_fail(cx, BS_EVALUE, "no structure");
    if (bs_mol_atom_count(mol) > MOL_ATOMS)
        return bs_fail(cx, BS_ELIMIT, "a structure of %d atoms; at most %d are read",
                       bs_mol_atom_count(mol), MOL_ATOMS);
    /* What cannot be weighed has no price per mole; this refuses unknown atoms too. */
    if ((st = bs_mol_mass(cx, mol, &mass)) != BS_OK ||
        (st = bs_smiles_canonical(cx, &cx->scratch, mol, 0, &smiles)) != BS_OK)
        return st;
    *out = (bs_offer){.smiles = smiles,
                      .price_per_gram = row->price_per_gram,
                      .container_g = row->container_g,
                      .lead_days = row->lead_days};
    if ((st = copy_clean(cx, &cx->scratch, row->code, &out->code)) != BS_OK)
        return st;
    return copy_clean(cx, &cx->scratch, row->name, &out->name);
}

static bool is_fatal(bs_status status)
{
    return status == BS_ENOMEM || status == BS_ESTOPPED || status == BS_EBUG;
}

static void count_refusal(bs_ctx *cx, const char *path, long line, bs_import_report *report)
{
    if (report->refused++ > 0)
        return;
    report->first_refused_line = line;
    snprintf(report->first_refused, sizeof report->first_refused, "'%.100s', line %ld: %.250s",
             path, line, cx->error.message);
}

static bs_status import_row(bs_ctx *cx, bs_store_writer *writer, const char *path,
                            const bs_row *row, bs_import_report *report)
{
    bs_mark temp = bs_arena_mark(&cx->scratch);
    bs_offer offer;
    bs_status st = read_offer(cx, row, &offer);

    report->lines++;
    if (st == BS_OK) {
        if ((st = bs_store__add(cx, writer, &offer)) == BS_OK)
            report->offers++;
    } else if (!is_fatal(st)) {
        count_refusal(cx, path, row->line, report);
        st = BS_OK;
    }
    bs_arena_rewind(&cx->scratch, temp);
    return st;
}

static bs_status import_list(bs_ctx *cx, bs_store_writer *writer, const char *path,
                             bs_import_report *report)
{
    bs_mark temp = bs_arena_mark(&cx->scratch);
    bs_rows *rows;
    bs_row row;
    bool more = true;
    bs_status st = bs_new(cx, &cx->scratch, 1, &rows);

    if (st == BS_OK && (st = bs_rows__open(cx, path, rows)) == BS_OK) {
        while ((st = bs_rows__next(rows, &row, &more)) == BS_OK && more) {
            if ((st = import_row(cx, writer, path, &row, report)) != BS_OK)
                break;
        }
        bs_rows__close(rows);
    }
    bs_arena_rewind(&cx->scratch, temp);
    return st;
}

/* ---- The file -------------------------------------------------------------------------- */

/* Where the output is, links resolved; refuses to write over anything but a catalogue. */
static bs_status find_output(bs_ctx *cx, const char *output, char **path)
{
    struct stat info;
    char *real;
    bs_status st;

    if (stat(output, &info) != 0)
        return bs_store__path(cx, &cx->scratch, output, path);
    if (info.st_size > 0 && bs_store__is_catalogue(cx, output) != BS_OK)
        return bs_fail(cx, BS_EFILE, "'%.200s' exists and is no catalogue; it is not overwritten",
                       output);
    if (!S_ISREG(info.st_mode))
        return bs_fail(cx, BS_EFILE, "'%.200s' is not a regular file", output);
    real = realpath(output, NULL);
    if (!real)
        return bs_fail(cx, BS_EFILE, "cannot open '%.200s': %s", output, strerror(errno));
    st = bs_copy_text(cx, &cx->scratch, real, strlen(real), path);
    free(real);
    return st;
}

/* Makes an empty file beside `path`; the usual rights of a new file apply. */
static bs_status make_beside(bs_ctx *cx, const char *path, char **name, int *fd)
{
    size_t room = strlen(path) + 40;
    bs_status st = bs_new(cx, &cx->scratch, room, name);

    *fd = -1;
    for (int i = 0; st == BS_OK && i < 100; i++) {
        snprintf(*name, room, "%s.new-%ld-%d", path, (long)getpid(), i);
        *fd = open(*name, O_RDWR | O_CREAT | O_EXCL | O_CLOEXEC, 0666);
        if (*fd >= 0)
            return BS_OK;
        if (errno != EEXIST)
            break;
    }
    return st == BS_OK ? bs_fail(cx, BS_EFILE, "cannot write '%.200s': %s", path, strerror(errno))
                       : st;
}

/* Brings a directory entry to disk. A file system that cannot do that is not our concern. */
static void sync_folder(const char *path)
{
    const char *slash = strrchr(path, '/');
    char *folder = strndup(path, slash ? (size_t)(slash - path) + 1 : 0);
    int fd = folder ? open(*folder ? folder : ".", O_RDONLY | O_DIRECTORY | O_CLOEXEC) : -1;

    if (fd >= 0) {
        fsync(fd);
        close(fd);
    }
    free(folder);
}

static bs_status write_file(bs_ctx *cx, const char *const *inputs, int input_count,
                            const char *path, const char *output, bs_import_report *report)
{
    bs_store_writer writer;
    bs_status st = bs_store__begin(cx, path, output, &writer);

    for (int i = 0; st == BS_OK && i < input_count; i++)
        st = import_list(cx, &writer, inputs[i], report);
    if (st == BS_OK && report->offers == 0)
        st = report->refused > 0
                 ? bs_fail(cx, BS_EVALUE, "no line could be used; %s", report->first_refused)
                 : bs_fail(cx, BS_EVALUE, "'%.200s' holds no compound",
                           input_count > 0 ? inputs[0] : "");
    if (st == BS_OK)
        st = bs_store__commit(cx, &writer);
    bs_store__close(&writer);
    return st;
}

bs_status bs_catalogue_build(bs_ctx *cx, const char *const *inputs, int input_count,
                             const char *output, bs_import_report *report)
{
    bs_mark temp = bs_arena_mark(&cx->scratch);
    char *path, *name = NULL;
    int fd = -1;
    bs_status st;

    *report = (bs_import_report){0};
    if ((st = find_output(cx, output, &path)) != BS_OK ||
        (st = make_beside(cx, path, &name, &fd)) != BS_OK)
        goto done;
    st = write_file(cx, inputs, input_count, name, output, report);
    if (st == BS_OK && (fsync(fd) != 0 || rename(name, path) != 0))
        st = bs_fail(cx, BS_EFILE, "cannot write '%.200s': %s", output, strerror(errno));
    if (st == BS_OK)
        sync_folder(path);
    else
        unlink(name);
done:
    if (fd >= 0)
        close(fd);
    bs_arena_rewind(&cx->scratch, temp);
    return st;
}
