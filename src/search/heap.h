/* A binary heap of numbered items: least key first, among equal keys the lowest number. */
#ifndef SEARCH_HEAP_H
#define SEARCH_HEAP_H

#include "backsaw/core.h"

typedef struct bs_heap_entry {
    double key;
    uint32_t item;
} bs_heap_entry;

/* All zero is an empty heap. */
typedef struct bs_heap {
    bs_heap_entry *entries;
    size_t count, room;
} bs_heap;

/* An item may be in the heap several times. On BS_ENOMEM the heap is as it was. */
bs_status bs_heap__push(bs_heap *heap, bs_ctx *cx, double key, uint32_t item);

/* Takes the least entry off; the heap must not be empty. */
bs_heap_entry bs_heap__pop(bs_heap *heap);

void bs_heap__free(bs_heap *heap, bs_ctx *cx);

#endif
