/*
 * Context, errors and memory: what every other module of backsaw builds on.
 *
 * One context (`bs_ctx`) is the first argument of every call that can fail, and one thread uses
 * it at a time. A call returns a `bs_status`; what went wrong stands in `cx->error`, which is
 * meaningful only after a status other than BS_OK. Absence (no match, no offer) is no error.
 *
 * Memory comes from arenas. An arena only grows; it is rewound to a mark or freed as a whole, and
 * nothing in it is freed alone. `cx->scratch` holds intermediate results: whoever takes from it
 * takes a mark first and rewinds before returning. Results live in an arena that the caller names
 * (the parameter `home`), so nothing returned belongs to a callee.
 *
 * Text has a length; it need not end in a NUL, and NUL bytes in it are data. Indices in C start
 * at 0.
 */
#ifndef BACKSAW_CORE_H
#define BACKSAW_CORE_H

#include <stdatomic.h>
#include <stdbool.h>
#include <stddef.h>
#include <stdint.h>

#define BS_STATUS_LIST(X)                                                                          \
    X(BS_OK, "ok")                                                                                 \
    X(BS_ENOMEM, "out of memory")                                                                  \
    X(BS_ESYNTAX, "syntax error")                                                                  \
    X(BS_EVALUE, "bad value")                                                                      \
    X(BS_ERANGE, "out of range")                                                                   \
    X(BS_ENOTFOUND, "not found")                                                                   \
    X(BS_ELIMIT, "limit reached")                                                                  \
    X(BS_ESTOPPED, "stopped")                                                                      \
    X(BS_EFILE, "file error")                                                                      \
    X(BS_ESCRIPT, "script error")                                                                  \
    X(BS_EBUG, "internal error")

typedef enum bs_status {
#define X(code, text) code,
    BS_STATUS_LIST(X)
#undef X
} bs_status;

/* The word for a status, such as "syntax error"; never NULL. */
const char *bs_status_text(bs_status status);

#define BS_MESSAGE_MAX 400

/*
 * What went wrong. `message` is one line without a full stop. `offset` is the byte of the input
 * at which it went wrong, 0-based, or -1; `line` is the line of a file, 1-based, or 0.
 */
typedef struct bs_error {
    bs_status code;
    long offset;
    long line;
    char message[BS_MESSAGE_MAX];
} bs_error;

/*
 * The gate through which all memory of a context comes. Several contexts may share one gate.
 * `limit` (bytes, 0 for none) is checked against `used`. For tests, `fail_after` counts the
 * requests that still succeed (negative: all do).
 */
typedef struct bs_gate {
    _Atomic size_t used;
    size_t limit;
    _Atomic long fail_after;
} bs_gate;

/* Zeroed memory of `size` bytes, or NULL. Release with bs_gate_free() and the same size. */
void *bs_gate_alloc(bs_gate *gate, size_t size);

/* Resizes a block of the gate; new bytes are not cleared. On NULL the old block stands. */
void *bs_gate_resize(bs_gate *gate, void *block, size_t old_size, size_t new_size);

/* Gives a block back; NULL is allowed. */
void bs_gate_free(bs_gate *gate, void *block, size_t size);

/* ---- Arenas ---------------------------------------------------------------------------- */

typedef struct bs_arena_chunk bs_arena_chunk;

typedef struct bs_arena {
    bs_gate *gate;
    bs_arena_chunk *top;
    bs_arena_chunk *spare; /* a chunk that a rewind emptied, kept for the next request */
    size_t live;           /* bytes handed out and not rewound */
} bs_arena;

/* A place in an arena to go back to. Valid until an earlier mark is rewound. */
typedef struct bs_mark {
    bs_arena_chunk *chunk;
    size_t used;
    size_t live;
} bs_mark;

/* Makes an empty arena. Cannot fail; memory is taken on first use. */
void bs_arena_init(bs_arena *arena, bs_gate *gate);

/* Frees everything in the arena and leaves it empty and usable. */
void bs_arena_free(bs_arena *arena);

/*
 * `size` bytes aligned for any type, not cleared. NULL when memory runs out: callers go through
 * bs_new(), which reports it.
 */
void *bs_arena_alloc(bs_arena *arena, size_t size);

bs_mark bs_arena_mark(const bs_arena *arena);

/* Gives back all that was taken after the mark. */
void bs_arena_rewind(bs_arena *arena, bs_mark mark);

/* ---- Context --------------------------------------------------------------------------- */

/*
 * `stop` points at a flag that another thread or a signal handler may set; long loops poll it
 * through bs_poll(). It points at `own_stop` unless the owner shares another.
 */
typedef struct bs_ctx {
    bs_error error;
    bs_gate *gate;
    bs_gate own_gate;
    bs_arena scratch;
    atomic_bool *stop;
    atomic_bool own_stop;
    long *budget; /* work that may still be done, see bs_spend(); NULL for any amount */
} bs_ctx;

/* Makes a context that uses `gate`, or a gate of its own if NULL. Cannot fail. */
void bs_ctx_init(bs_ctx *cx, bs_gate *gate);

/* Frees the scratch arena. Results in other arenas stay; they must be freed before the gate. */
void bs_ctx_free(bs_ctx *cx);

/* Fills the error (offset -1, line 0) and returns `code`. Control bytes in the text are escaped. */
bs_status bs_fail(bs_ctx *cx, bs_status code, const char *format, ...)
    __attribute__((format(printf, 3, 4)));

/* The same with the byte of the input at which it went wrong. */
bs_status bs_fail_at(bs_ctx *cx, bs_status code, size_t offset, const char *format, ...)
    __attribute__((format(printf, 4, 5)));

/* The one way to report that memory ran out. */
bs_status bs_fail_memory(bs_ctx *cx);

/*
 * That these never return BS_OK is out of the compiler's sight; the macros show it, so that it
 * walks no path that does not exist. They evaluate `code` twice.
 */
static inline bs_status bs_fail__code(bs_status reported, bs_status code)
{
    (void)reported;
    return code;
}

#define bs_fail(cx, code, ...) bs_fail__code((bs_fail)((cx), (code), __VA_ARGS__), (code))
#define bs_fail_at(cx, code, offset, ...)                                                          \
    bs_fail__code((bs_fail_at)((cx), (code), (offset), __VA_ARGS__), (code))
#define bs_fail_memory(cx) bs_fail__code((bs_fail_memory)(cx), BS_ENOMEM)

/*
 * BS_ESTOPPED with a message if the stop flag is set, BS_ELIMIT if the context has a budget and it is
 * used up, else BS_OK. Cheap.
 */
bs_status bs_poll(bs_ctx *cx);

/*
 * Takes work from the budget of a context that has one, so that what C does for untrusted code
 * counts as well. A unit is about an instruction of Lua, 10 ns; the next poll sees what is left.
 */
static inline void bs_spend(bs_ctx *cx, size_t work)
{
    if (cx->budget)
        *cx->budget -= work < (size_t)1 << 40 ? (long)work : 1L << 40;
}

/*
 * Writes the line of `text` that holds error.offset, with a caret under the character, into
 * `out` (at most `size` bytes with the NUL; long lines are cut around the caret). Writes an empty
 * string if the error has no position.
 */
void bs_error_caret(const bs_error *error, const char *text, size_t length, char *out, size_t size);

/*
 * Room for `count` elements of `size` bytes in `arena`, cleared.
 *
 *   errors  BS_ENOMEM  memory ran out, the limit was hit or count * size overflows; *out is NULL
 */
bs_status bs_new_array(bs_ctx *cx, bs_arena *arena, size_t count, size_t size, void *out);

/* A cleared array of `count` elements of the type that `pointer` points at. */
#define bs_new(cx, arena, count, pointer)                                                          \
    bs_new_array((cx), (arena), (size_t)(count), sizeof **(pointer), (pointer))

/* A copy of `length` bytes with a NUL behind. */
bs_status bs_copy_text(bs_ctx *cx, bs_arena *arena, const char *text, size_t length, char **out);

/* ---- Text buffer ----------------------------------------------------------------------- */

/*
 * A growing text. `data` always ends in a NUL once anything was added, and is NULL before. It
 * takes its memory from the gate: free it. After a failed call the text is as it was.
 */
typedef struct bs_text {
    bs_ctx *cx;
    char *data;
    size_t length;
    size_t room;
} bs_text;

void bs_text_init(bs_text *text, bs_ctx *cx);
void bs_text_free(bs_text *text);
bs_status bs_text_add(bs_text *text, const char *bytes, size_t length);
bs_status bs_text_puts(bs_text *text, const char *string);
bs_status bs_text_putc(bs_text *text, char c);
bs_status bs_text_printf(bs_text *text, const char *format, ...)
    __attribute__((format(printf, 2, 3)));

/* Empties the text and keeps its room. */
void bs_text_clear(bs_text *text);

/* ---- Files ----------------------------------------------------------------------------- */

/*
 * Reads a whole regular file of at most `limit` bytes; a NUL is put behind.
 *
 *   home    arena of the result
 *   errors  BS_EFILE   no such file, no regular file, not readable
 *           BS_ELIMIT  larger than `limit`
 *           BS_ENOMEM
 */
bs_status bs_read_file(bs_ctx *cx, bs_arena *home, const char *path, size_t limit, char **data,
                       size_t *length);

/* The SHA-256 digest (FIPS 180-4) of a text, in hexadecimal with a NUL behind. */
void bs_sha256(const void *data, size_t length, char hex[65]);

#endif
