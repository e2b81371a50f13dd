/* A folder of its own for each case, and files in it. */
#ifndef CATALOGUE_FOLDER_H
#define CATALOGUE_FOLDER_H

#include "support/check.h"

#include <dirent.h>
#include <stdio.h>
#include <stdlib.h>
#include <string.h>
#include <unistd.h>
#include <zlib.h>

typedef struct folder {
    fixture *f;
    char path[64];
    char name[8][400]; /* full names that were asked for, in turn */
    int next;
} folder;

static inline int folder_setup(void **state)
{
    static folder d;

    if (fixture_setup(state) != 0)
        return -1;
    memset(&d, 0, sizeof d);
    d.f = *state;
    strcpy(d.path, "/tmp/backsaw-test-XXXXXX");
    if (!mkdtemp(d.path))
        return -1;
    *state = &d;
    return 0;
}

/* The full name of a file in the folder; good for the next seven calls. */
static inline const char *folder_name(folder *d, const char *file)
{
    char *name = d->name[d->next++ % 8];

    snprintf(name, sizeof d->name[0], "%s/%s", d->path, file);
    return name;
}

static inline int folder_teardown(void **state)
{
    folder *d = *state;
    DIR *dir = opendir(d->path);
    struct dirent *entry;

    while (dir && (entry = readdir(dir)))
        if (entry->d_name[0] != '.')
            remove(folder_name(d, entry->d_name));
    if (dir)
        closedir(dir);
    rmdir(d->path);
    *state = d->f;
    return fixture_teardown(state);
}

/* Files in the folder. */
static inline int folder_count(folder *d)
{
    DIR *dir = opendir(d->path);
    struct dirent *entry;
    int count = 0;

    assert_non_null(dir);
    while ((entry = readdir(dir)))
        count += entry->d_name[0] != '.';
    closedir(dir);
    return count;
}

/* Writes a file, through zlib where its name ends in .gz; returns its full name. */
static inline const char *folder_write(folder *d, const char *file, const char *bytes,
                                       size_t length)
{
    const char *name = folder_name(d, file);
    gzFile out = gzopen(name, strstr(file, ".gz") ? "wb" : "wbT");

    assert_non_null(out);
    if (length > 0)
        assert_int_equal(gzwrite(out, bytes, (unsigned)length), (int)length);
    assert_int_equal(gzclose(out), Z_OK);
    return name;
}

static inline const char *folder_puts(folder *d, const char *file, const char *text)
{
    return folder_write(d, file, text, strlen(text));
}

/* All bytes of a file, from malloc. */
static inline char *folder_slurp(const char *name, size_t *length)
{
    FILE *in = fopen(name, "rb");
    char *bytes;
    long size;

    assert_non_null(in);
    assert_int_equal(fseek(in, 0, SEEK_END), 0);
    size = ftell(in);
    assert_true(size >= 0);
    rewind(in);
    bytes = malloc((size_t)size + 1);
    assert_non_null(bytes);
    assert_int_equal(fread(bytes, 1, (size_t)size, in), size);
    fclose(in);
    *length = (size_t)size;
    return bytes;
}

#define folder_case(function)                                                                      \
    cmocka_unit_test_setup_teardown(function, folder_setup, folder_teardown)

#endif
