/*
 * A hash map from 64-bit keys to 32-bit values, open addressing, in an arena.
 *
 * Keys are hashes that the caller made; two entries may share a key, so a caller whose keys can
 * collide walks them with bs_map_next() and compares the real thing. Nothing is ever removed. The
 * order of entries never shows.
 */
#ifndef CORE_MAP_H
#define CORE_MAP_H

#include "backsaw/core.h"

typedef struct bs_map_slot {
    uint64_t key;
    uint32_t value; /* value + 1; 0 is an empty slot */
    uint32_t spare;
} bs_map_slot;

typedef struct bs_map {
    bs_ctx *cx;
    bs_map_slot *slots; /* from the gate of cx */
    size_t room;        /* a power of two, or 0 */
    size_t count;
} bs_map;

#define BS_MAP_NONE UINT32_MAX

/* Makes an empty map; free it with bs_map_free(). */
void bs_map_init(bs_map *map, bs_ctx *cx);
void bs_map_free(bs_map *map);

/* Adds an entry. On BS_ENOMEM the map is as it was. `value` must not be BS_MAP_NONE. */
bs_status bs_map_add(bs_map *map, uint64_t key, uint32_t value);

/*
 * The next value under `key`, or BS_MAP_NONE. `*cursor` is 0 for the first call and belongs to
 * the map in between; no entry may be added meanwhile.
 */
uint32_t bs_map_next(const bs_map *map, uint64_t key, size_t *cursor);

/* A 64-bit hash of `length` bytes; the same on every machine. `seed` gives independent hashes. */
uint64_t bs_hash_bytes(const void *bytes, size_t length, uint64_t seed);

/* Mixes a word into a hash. */
static inline uint64_t bs_hash_mix(uint64_t hash, uint64_t word)
{
    /* The finaliser of splitmix64 (Steele, Lea & Flood 2014) over the sum. */
    uint64_t z = hash + word + 0x9E3779B97F4A7C15u;

    z = (z ^ (z >> 30)) * 0xBF58476D1CE4E5B9u;
    z = (z ^ (z >> 27)) * 0x94D049BB133111EBu;
    return z ^ (z >> 31);
}

#endif
