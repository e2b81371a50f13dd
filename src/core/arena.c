/* The allocation gate and the arenas on top of it. */
#include "backsaw/core.h"

#include <stdlib.h>
#include <string.h>

#ifndef BS_ARENA_DEBUG
#define BS_ARENA_DEBUG 0
#endif

#define CHUNK_BYTES ((size_t)16 * 1024)
#define ALIGNMENT sizeof(max_align_t)

/* ---- Gate ------------------------------------------------------------------------------ */

/* Takes `size` bytes from the budget; false if the limit or a test's counter forbids it. */
static bool gate_pass(bs_gate *gate, size_t size)
{
    size_t before;

    if (atomic_load(&gate->fail_after) >= 0 && atomic_fetch_sub(&gate->fail_after, 1) <= 0) {
        atomic_store(&gate->fail_after, 0);
        return false;
    }
    before = atomic_fetch_add(&gate->used, size);
    if (gate->limit != 0 && (size > gate->limit || before > gate->limit - size)) {
        atomic_fetch_sub(&gate->used, size);
        return false;
    }
    return true;
}

void *bs_gate_alloc(bs_gate *gate, size_t size)
{
    void *block;

    if (!gate_pass(gate, size))
        return NULL;
    block = calloc(1, size ? size : 1);
    if (!block)
        atomic_fetch_sub(&gate->used, size);
    return block;
}

void *bs_gate_resize(bs_gate *gate, void *block, size_t old_size, size_t new_size)
{
    void *moved;

    if (!gate_pass(gate, new_size))
        return NULL;
    moved = realloc(block, new_size ? new_size : 1);
    atomic_fetch_sub(&gate->used, moved ? old_size : new_size);
    return moved;
}

void bs_gate_free(bs_gate *gate, void *block, size_t size)
{
    if (!block)
        return;
    atomic_fetch_sub(&gate->used, size);
    free(block);
}

/* ---- Arena ----------------------------------------------------------------------------- */

struct bs_arena_chunk {
    bs_arena_chunk *below;
    size_t room; /* bytes behind the header */
    size_t used;
};

static size_t header_bytes(void)
{
    return (sizeof(bs_arena_chunk) + ALIGNMENT - 1) / ALIGNMENT * ALIGNMENT;
}

void bs_arena_init(bs_arena *arena, bs_gate *gate)
{
    arena->gate = gate;
    arena->top = NULL;
    arena->spare = NULL;
    arena->live = 0;
}

static void release(bs_arena *arena, bs_arena_chunk *chunk)
{
    if (chunk)
        bs_gate_free(arena->gate, chunk, header_bytes() + chunk->room);
}

static void drop_top(bs_arena *arena)
{
    bs_arena_chunk *chunk = arena->top;

    arena->top = chunk->below;
    release(arena, chunk);
}

void bs_arena_free(bs_arena *arena)
{
    while (arena->top)
        drop_top(arena);
    release(arena, arena->spare);
    arena->spare = NULL;
    arena->live = 0;
}

/*
 * Takes the top chunk off and keeps the larger of it and the spare one: a loop of marks and rewinds
 * at the end of a chunk would else ask the gate for a new chunk each time.
 */
static void retire_top(bs_arena *arena)
{
    bs_arena_chunk *chunk = arena->top;

    arena->top = chunk->below;
    if (BS_ARENA_DEBUG || chunk->room > CHUNK_BYTES * 64 ||
        (arena->spare && arena->spare->room >= chunk->room)) {
        release(arena, chunk);
        return;
    }
    release(arena, arena->spare);
    arena->spare = chunk;
}

/* Chunks double up to 1 MiB, so that a large result does not need many. */
static bool add_chunk(bs_arena *arena, size_t size)
{
    size_t room = arena->top ? arena->top->room * 2 : CHUNK_BYTES;
    bs_arena_chunk *chunk;

    if (room > CHUNK_BYTES * 64)
        room = CHUNK_BYTES * 64;
    if (BS_ARENA_DEBUG || room < size)
        room = size;
    if (room > SIZE_MAX - header_bytes())
        return false;
    if (arena->spare && arena->spare->room >= size) {
        chunk = arena->spare;
        arena->spare = NULL;
    } else {
        /* Not cleared: what wants zeros clears its own part. */
        chunk = bs_gate_resize(arena->gate, NULL, 0, header_bytes() + room);
        if (!chunk)
            return false;
        chunk->room = room;
    }
    chunk->below = arena->top;
    chunk->used = 0;
    arena->top = chunk;
    return true;
}

void *bs_arena_alloc(bs_arena *arena, size_t size)
{
    char *block;

    if (size == 0)
        size = 1;
    if (size > SIZE_MAX - ALIGNMENT)
        return NULL;
    /* The debug build keeps odd sizes, so that the sanitizer sees the first byte behind. */
    if (!BS_ARENA_DEBUG)
        size = (size + ALIGNMENT - 1) / ALIGNMENT * ALIGNMENT;
    if (!arena->top || BS_ARENA_DEBUG || arena->top->room - arena->top->used < size) {
        if (!add_chunk(arena, size))
            return NULL;
    }
    block = (char *)arena->top + header_bytes() + arena->top->used;
    arena->top->used += size;
    arena->live += size;
    return block;
}

bs_mark bs_arena_mark(const bs_arena *arena)
{
    return (bs_mark){arena->top, arena->top ? arena->top->used : 0, arena->live};
}

void bs_arena_rewind(bs_arena *arena, bs_mark mark)
{
    while (arena->top != mark.chunk) {
        /* The last chunk of an empty arena is kept: most marks are taken and rewound in a loop. */
        if (!BS_ARENA_DEBUG && !mark.chunk && !arena->top->below) {
            arena->top->used = 0;
            arena->live = 0;
            return;
        }
        retire_top(arena);
    }
    if (arena->top)
        arena->top->used = mark.used;
    arena->live = mark.live;
}

bs_status bs_new_array(bs_ctx *cx, bs_arena *arena, size_t count, size_t size, void *out)
{
    void *block = NULL;
    bs_status st = BS_OK;

    if (size != 0 && count > SIZE_MAX / 2 / size)
        st = bs_fail_memory(cx);
    else if (!(block = bs_arena_alloc(arena, count * size)))
        st = bs_fail_memory(cx);
    else
        memset(block, 0, count * size);
    memcpy(out, &block, sizeof block);
    return st;
}

bs_status bs_copy_text(bs_ctx *cx, bs_arena *arena, const char *text, size_t length, char **out)
{
    bs_status st = bs_new_array(cx, arena, length + 1, 1, out);

    if (st == BS_OK && length > 0)
        memcpy(*out, text, length);
    return st;
}
