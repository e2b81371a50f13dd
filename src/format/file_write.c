/*
 * Writing files of molecules, record by record. What is written goes to a file beside the one that
 * is wanted, which takes its name when it is finished: no half of a file is ever seen.
 */
#include "backsaw/file.h"

#include "backsaw/format.h"
#include "format/kind.h"

#include <errno.h>
#include <fcntl.h>
#include <stdio.h>
#include <string.h>
#include <unistd.h>
#include <zlib.h>

struct bs_file_writer {
    bs_ctx *cx;
    gzFile stream;
    bs_file_kind kind;
    bs_text text;   /* of the record in hand */
    char *path;     /* wanted */
    char *beside;   /* written */
    bs_arena names; /* of both */
};

static bs_status cannot_write(const bs_file_writer *w)
{
    return bs_fail(w->cx, BS_EFILE, "%s: cannot be written: %s", w->path,
                   errno ? strerror(errno) : "the disk may be full");
}

/* Makes a file that is not there yet. */
static bs_status make_beside(bs_file_writer *w, const char *path)
{
    size_t length = strlen(path);
    bool gzip = bs_file__is_gzip(path);
    int file = -1;
    bs_status st = bs_copy_text(w->cx, &w->names, path, length, &w->path);

    if (st != BS_OK || (st = bs_new(w->cx, &w->names, length + 48, &w->beside)) != BS_OK)
        return st;
    for (int i = 0; i < 1000 && file < 0; i++) {
        snprintf(w->beside, length + 48, "%s.%ld-%d", w->path, (long)getpid(), i);
        file = open(w->beside, O_WRONLY | O_CREAT | O_EXCL | O_CLOEXEC, 0666);
        if (file < 0 && errno != EEXIST)
            break;
    }
    if (file < 0) {
        w->beside = NULL;
        return cannot_write(w);
    }
    w->stream = gzdopen(file, gzip ? "wb" : "wbT");
    if (w->stream)
        return BS_OK;
    close(file);
    return bs_fail_memory(w->cx);
}

bs_status bs_file_create(bs_ctx *cx, const char *path, bs_file_writer **out)
{
    bs_file_kind kind = bs_file__kind(path);
    bs_file_writer *w;
    bs_status st;

    *out = NULL;
    if (kind == BS_FILE_BY_NAME)
        return bs_fail(cx, BS_EVALUE,
                       "the name '%.200s' does not tell what to write; .sdf, .mol or .smi was "
                       "expected, or one of them with .gz",
                       path);
    w = bs_gate_alloc(cx->gate, sizeof *w);
    if (!w)
        return bs_fail_memory(cx);
    *w = (bs_file_writer){.cx = cx, .kind = kind};
    bs_text_init(&w->text, cx);
    bs_arena_init(&w->names, cx->gate);
    if ((st = make_beside(w, path)) != BS_OK) {
        bs_file_abandon(w);
        return st;
    }
    *out = w;
    return BS_OK;
}

/* SMILES, a blank, the name; line breaks in the name become blanks. */
static bs_status put_smiles(bs_file_writer *w, const bs_record *record)
{
    bs_mark temp = bs_arena_mark(&w->cx->scratch);
    bs_arena home;
    char *smiles;
    bs_status st;

    bs_arena_init(&home, w->cx->gate);
    if ((st = bs_smiles_canonical(w->cx, &home, record->mol, BS_SMILES_LABELS, &smiles)) == BS_OK &&
        (st = bs_text_puts(&w->text, smiles)) == BS_OK && record->name_length > 0)
        st = bs_text_putc(&w->text, ' ');
    for (size_t i = 0; i < record->name_length && st == BS_OK; i++)
        st = bs_text_putc(&w->text, strchr("\r\n", record->name[i]) ? ' ' : record->name[i]);
    if (st == BS_OK)
        st = bs_text_putc(&w->text, '\n');
    bs_arena_free(&home);
    bs_arena_rewind(&w->cx->scratch, temp);
    return st;
}

bs_status bs_file_put(bs_file_writer *w, const bs_record *record, int *lost)
{
    bs_status st;
    int none;

    bs_text_clear(&w->text);
    *(lost ? lost : &none) = 0;
    st = w->kind == BS_FILE_SMILES
             ? put_smiles(w, record)
             : bs_sdf_write(&w->text, record, BS_MOLFILE_AUTO, lost ? lost : &none);
    if (st != BS_OK)
        return st;
    errno = 0;
    if (w->text.length > INT32_MAX ||
        gzwrite(w->stream, w->text.data, (unsigned)w->text.length) != (int)w->text.length)
        return cannot_write(w);
    return bs_poll(w->cx);
}

bs_status bs_file_finish(bs_file_writer *w)
{
    bs_status st = BS_OK;
    int closed;

    errno = 0;
    closed = gzclose(w->stream);
    w->stream = NULL;
    if (closed != Z_OK || rename(w->beside, w->path) != 0)
        st = cannot_write(w);
    else
        w->beside = NULL;
    bs_file_abandon(w);
    return st;
}

void bs_file_abandon(bs_file_writer *w)
{
    if (!w)
        return;
    if (w->stream)
        gzclose(w->stream);
    if (w->beside)
        unlink(w->beside);
    bs_text_free(&w->text);
    bs_arena_free(&w->names);
    bs_gate_free(w->cx->gate, w, sizeof *w);
}
