/* The hash map of map.h: linear probing, at most three quarters full. */
#include "core/map.h"

#include <string.h>

void bs_map_init(bs_map *map, bs_ctx *cx)
{
    *map = (bs_map){.cx = cx};
}

void bs_map_free(bs_map *map)
{
    bs_gate_free(map->cx->gate, map->slots, map->room * sizeof *map->slots);
    bs_map_init(map, map->cx);
}

static void put(bs_map_slot *slots, size_t room, bs_map_slot entry)
{
    size_t at = (size_t)bs_hash_mix(0, entry.key) & (room - 1);

    while (slots[at].value != 0)
        at = (at + 1) & (room - 1);
    slots[at] = entry;
}

static bs_status grow(bs_map *map)
{
    size_t room = map->room ? map->room * 2 : 16;
    bs_map_slot *slots;

    if (room > SIZE_MAX / 2 / sizeof *slots)
        return bs_fail_memory(map->cx);
    slots = bs_gate_alloc(map->cx->gate, room * sizeof *slots);
    if (!slots)
        return bs_fail_memory(map->cx);
    for (size_t i = 0; i < map->room; i++) {
        if (map->slots[i].value != 0)
            put(slots, room, map->slots[i]);
    }
    bs_gate_free(map->cx->gate, map->slots, map->room * sizeof *map->slots);
    map->slots = slots;
    map->room = room;
    return BS_OK;
}

bs_status bs_map_add(bs_map *map, uint64_t key, uint32_t value)
{
    bs_status st;

    if (value == BS_MAP_NONE)
        return bs_fail(map->cx, BS_EBUG, "the value cannot be kept in a map");
    if ((map->count + 1) * 4 > map->room * 3 && (st = grow(map)) != BS_OK)
        return st;
    put(map->slots, map->room, (bs_map_slot){.key = key, .value = value + 1});
    map->count++;
    return BS_OK;
}

uint32_t bs_map_next(const bs_map *map, uint64_t key, size_t *cursor)
{
    size_t start;

    if (map->room == 0)
        return BS_MAP_NONE;
    start = (size_t)bs_hash_mix(0, key) & (map->room - 1);
    for (size_t step = *cursor; step < map->room; step++) {
        const bs_map_slot *slot = &map->slots[(start + step) & (map->room - 1)];

        if (slot->value == 0)
            break;
        if (slot->key == key) {
            *cursor = step + 1;
            return slot->value - 1;
        }
    }
    *cursor = map->room;
    return BS_MAP_NONE;
}

uint64_t bs_hash_bytes(const void *bytes, size_t length, uint64_t seed)
{
    const unsigned char *at = bytes;
    uint64_t hash = bs_hash_mix(seed, length);

    for (; length >= 8; length -= 8, at += 8) {
        uint64_t word = 0;

        for (int i = 0; i < 8; i++)
            word |= (uint64_t)at[i] << (8 * i);
        hash = bs_hash_mix(hash, word);
    }
    if (length > 0) {
        uint64_t word = 0;

        for (size_t i = 0; i < length; i++)
            word |= (uint64_t)at[i] << (8 * i);
        hash = bs_hash_mix(hash, word);
    }
    return hash;
}
