/* The heap of heap.h. */
#include "search/heap.h"

#include "search/graph.h"

static bool before(bs_heap_entry a, bs_heap_entry b)
{
    return a.key != b.key ? a.key < b.key : a.item < b.item;
}

bs_status bs_heap__push(bs_heap *heap, bs_ctx *cx, double key, uint32_t item)
{
    bs_heap_entry entry = {key, item};
    size_t at = heap->count;
    bs_status st =
        bs_graph__reserve(cx, &heap->entries, &heap->room, at + 1, sizeof *heap->entries);

    if (st != BS_OK)
        return st;
    heap->count++;
    for (; at > 0 && before(entry, heap->entries[(at - 1) / 2]); at = (at - 1) / 2)
        heap->entries[at] = heap->entries[(at - 1) / 2];
    heap->entries[at] = entry;
    return BS_OK;
}

bs_heap_entry bs_heap__pop(bs_heap *heap)
{
    bs_heap_entry *e = heap->entries, top = e[0], last = e[--heap->count];
    size_t at = 0, child;

    while ((child = 2 * at + 1) < heap->count) {
        if (child + 1 < heap->count && before(e[child + 1], e[child]))
            child++;
        if (!before(e[child], last))
            break;
        e[at] = e[child];
        at = child;
    }
    if (heap->count > 0)
        e[at] = last;
    return top;
}

void bs_heap__free(bs_heap *heap, bs_ctx *cx)
{
    bs_gate_free(cx->gate, heap->entries, heap->room * sizeof *heap->entries);
    *heap = (bs_heap){NULL, 0, 0};
}
