/* Bounded reading of whole files. */
#include "backsaw/core.h"

#include <errno.h>
#include <fcntl.h>
#include <string.h>
#include <sys/stat.h>
#include <unistd.h>

/* O_NONBLOCK: opening a FIFO must not wait for a writer. */
static bs_status open_regular(bs_ctx *cx, const char *path, int *fd, size_t *size)
{
    struct stat info;

    *fd = open(path, O_RDONLY | O_NONBLOCK | O_CLOEXEC);
    if (*fd < 0)
        return bs_fail(cx, BS_EFILE, "cannot open '%.200s': %s", path, strerror(errno));
    if (fstat(*fd, &info) != 0 || !S_ISREG(info.st_mode))
        return bs_fail(cx, BS_EFILE, "'%.200s' is not a regular file", path);
    *size = (size_t)info.st_size;
    return BS_OK;
}

static bs_status fill(bs_ctx *cx, int fd, const char *path, char *data, size_t size, size_t *got)
{
    *got = 0;
    while (*got < size) {
        ssize_t n = read(fd, data + *got, size - *got);

        if (n < 0 && errno == EINTR)
            continue;
        if (n < 0)
            return bs_fail(cx, BS_EFILE, "cannot read '%.200s': %s", path, strerror(errno));
        if (n == 0)
            break;
        *got += (size_t)n;
    }
    return BS_OK;
}

bs_status bs_read_file(bs_ctx *cx, bs_arena *home, const char *path, size_t limit, char **data,
                       size_t *length)
{
    bs_mark kept = bs_arena_mark(home);
    int fd = -1;
    size_t size = 0;
    bs_status st;

    *data = NULL;
    *length = 0;
    if ((st = open_regular(cx, path, &fd, &size)) != BS_OK)
        goto done;
    if (size > limit) {
        st = bs_fail(cx, BS_ELIMIT, "'%.200s' has %zu bytes; at most %zu are read", path, size,
                     limit);
        goto done;
    }
    if ((st = bs_new(cx, home, size + 1, data)) != BS_OK)
        goto done;
    st = fill(cx, fd, path, *data, size, length);
done:
    if (fd >= 0)
        close(fd);
    if (st != BS_OK) {
        bs_arena_rewind(home, kept);
        *data = NULL;
        *length = 0;
    }
    return st;
}
