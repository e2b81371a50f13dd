/* Ordered partitions of atoms and their refinement; see chem/canon.h. */
#include "chem/canon.h"

#include <string.h>

#include "core/map.h"

enum { SMALL_SORT = 24 };

bs_status bs_canon__cells_new(bs_ctx *cx, uint32_t atom_count, bs_canon_cells *cells)
{
    size_t n = atom_count;
    uint32_t *words;
    bs_status st;

    memset(cells, 0, sizeof *cells);
    cells->atom_count = atom_count;
    if ((st = bs_new(cx, &cx->scratch, n, &cells->sum)) != BS_OK ||
        (st = bs_new(cx, &cx->scratch, n, &cells->queued)) != BS_OK ||
        (st = bs_new(cx, &cx->scratch, 9 * n, &words)) != BS_OK)
        return st;
    cells->lab = words;
    cells->place = words + n;
    cells->colour = words + 2 * n;
    cells->size = words + 3 * n;
    cells->split = words + 4 * n;
    cells->queue = words + 5 * n;
    cells->hit = words + 6 * n;
    cells->hits = words + 7 * n;
    cells->members = words + 8 * n;
    return BS_OK;
}

/* ---- Sorting --------------------------------------------------------------------------- */

static inline bool precedes(uint32_t a, uint32_t b, const uint64_t *key)
{
    return key ? key[a] < key[b] : a < b;
}

/* Lets the item at `root` sink in the heap of the largest. */
static void sift(uint32_t *items, uint32_t root, uint32_t count, const uint64_t *key)
{
    uint32_t item = items[root];

    for (;;) {
        uint32_t child = 2 * root + 1;

        if (child >= count)
            break;
        if (child + 1 < count && precedes(items[child], items[child + 1], key))
            child++;
        if (!precedes(item, items[child], key))
            break;
        items[root] = items[child];
        root = child;
    }
    items[root] = item;
}

void bs_canon__sort(uint32_t *items, uint32_t count, const uint64_t *key)
{
    if (count <= SMALL_SORT) {
        for (uint32_t i = 1; i < count; i++) {
            uint32_t item = items[i], k = i;

            for (; k > 0 && precedes(item, items[k - 1], key); k--)
                items[k] = items[k - 1];
            items[k] = item;
        }
        return;
    }
    for (uint32_t i = count / 2; i-- > 0;)
        sift(items, i, count, key);
    for (uint32_t i = count; i-- > 1;) {
        uint32_t item = items[0];

        items[0] = items[i];
        items[i] = item;
        sift(items, 0, i, key);
    }
}

/* ---- Cells ----------------------------------------------------------------------------- */

static void enqueue(bs_canon_cells *cells, uint32_t start)
{
    uint32_t end = cells->queue_head + cells->queue_count;

    if (cells->queued[start])
        return;
    cells->queued[start] = 1;
    cells->queue[end < cells->atom_count ? end : end - cells->atom_count] = start;
    cells->queue_count++;
}

static uint32_t dequeue(bs_canon_cells *cells)
{
    uint32_t start = cells->queue[cells->queue_head];

    if (++cells->queue_head == cells->atom_count)
        cells->queue_head = 0;
    cells->queue_count--;
    cells->queued[start] = 0;
    return start;
}

static void clear_queue(bs_canon_cells *cells)
{
    while (cells->queue_count > 0)
        dequeue(cells);
    cells->queue_head = 0;
}

/* Gives lab[start .. start + size) one colour. */
static void make_cell(bs_canon_cells *cells, uint32_t start, uint32_t size)
{
    cells->size[start] = size;
    for (uint32_t i = start; i < start + size; i++)
        cells->colour[cells->lab[i]] = start;
}

static void exchange(bs_canon_cells *cells, uint32_t i, uint32_t k)
{
    uint32_t a = cells->lab[i], b = cells->lab[k];

    cells->lab[i] = b;
    cells->lab[k] = a;
    cells->place[a] = k;
    cells->place[b] = i;
}

/* Notes that an atom was met: it moves to the back of its cell. */
static void meet(bs_canon_cells *cells, uint32_t atom)
{
    uint32_t start = cells->colour[atom];

    if (cells->hits[start] == 0)
        cells->hit[cells->hit_count++] = start;
    exchange(cells, cells->place[atom], start + cells->size[start] - 1 - cells->hits[start]);
    cells->hits[start]++;
}

static void note(bs_canon_cells *cells, uint64_t word)
{
    cells->trace = bs_hash_mix(cells->trace, word);
}

/* Queues the parts of a cell that was split: all if it waited itself, else all but the largest. */
static void queue_parts(bs_canon_cells *cells, uint32_t start, uint32_t end, bool waited)
{
    uint32_t largest = start;

    if (!waited)
        for (uint32_t s = start; s < end; s += cells->size[s])
            if (cells->size[s] > cells->size[largest])
                largest = s;
    for (uint32_t s = start; s < end; s += cells->size[s])
        if (waited || s != largest)
            enqueue(cells, s);
}

/* Cuts one cell by the sums of its atoms; those that were met stand at its back. */
static void cut_cell(bs_canon_cells *cells, uint32_t start)
{
    uint32_t end = start + cells->size[start], met = end - cells->hits[start], part = start;
    bool waited = cells->queued[start];

    bs_canon__sort(cells->lab + met, end - met, cells->sum);
    for (uint32_t at = met; at < end; at++) {
        uint32_t atom = cells->lab[at];

        if (at > start && cells->sum[atom] != cells->sum[cells->lab[at - 1]]) {
            cells->size[part] = at - part;
            part = at;
            cells->split[cells->split_count++] = at;
            cells->cell_count++;
            note(cells, ((uint64_t)start << 32 | at) + (cells->sum[atom] << 7));
        }
        cells->place[atom] = at;
        cells->colour[atom] = part;
    }
    cells->size[part] = end - part;
    if (part != start)
        queue_parts(cells, start, end, waited);
    else
        note(cells, cells->sum[cells->lab[start]] ^ start);
}

/* Cuts all cells that were met, in their order, and clears the sums of the atoms. */
static void cut_cells(bs_canon_cells *cells)
{
    bs_canon__sort(cells->hit, cells->hit_count, NULL);
    for (uint32_t k = 0; k < cells->hit_count; k++) {
        uint32_t start = cells->hit[k], end = start + cells->size[start];
        uint32_t met = end - cells->hits[start];

        cut_cell(cells, start);
        cells->hits[start] = 0;
        for (uint32_t at = met; at < end; at++)
            cells->sum[cells->lab[at]] = 0;
    }
    cells->hit_count = 0;
}

/* Cuts the cells by the labels of their atoms. */
static void cut_by_label(bs_canon_cells *cells, const bs_canon_graph *graph)
{
    for (uint32_t at = 0; at < cells->atom_count; at++) {
        cells->sum[at] = bs_canon__label(graph, at);
        if (cells->sum[at] != 0)
            meet(cells, at);
    }
    cut_cells(cells);
}

/*
 * Sorts the atoms by key into `lab`. Few keys are different as a rule, so one atom of each is
 * sorted and the others are counted in; false, with nothing done, if there are many.
 */
static bool sort_by_few_keys(bs_canon_cells *cells, const uint64_t *key)
{
    enum { MOST = 64 };
    uint8_t last[64] = {0}; /* by hash of the key: its number + 1 */
    uint32_t first[MOST], size[MOST] = {0}, start[MOST];
    uint32_t n = cells->atom_count, count = 0, next = 0;

    for (uint32_t i = 0; i < n; i++) {
        uint8_t *place = &last[key[i] * 0x9E3779B97F4A7C15u >> 58];
        uint32_t k = *place ? *place - 1u : 0;

        if (!*place || key[first[k]] != key[i])
            for (k = 0; k < count && key[first[k]] != key[i]; k++)
                ;
        if (k == count) {
            if (count == MOST)
                return false;
            first[count++] = i;
        }
        *place = (uint8_t)(k + 1);
        cells->members[i] = k;
        size[k]++;
    }
    memcpy(cells->lab, first, count * sizeof *first);
    bs_canon__sort(cells->lab, count, key);
    for (uint32_t k = 0; k < count; k++) {
        uint32_t number = cells->members[cells->lab[k]];

        start[number] = next;
        next += size[number];
    }
    for (uint32_t i = 0; i < n; i++)
        cells->lab[start[cells->members[i]]++] = i;
    return true;
}

void bs_canon__cells_start(bs_canon_cells *cells, const bs_canon_graph *graph)
{
    uint32_t n = cells->atom_count, start = 0;

    if (!sort_by_few_keys(cells, graph->key)) {
        for (uint32_t i = 0; i < n; i++)
            cells->lab[i] = i;
        bs_canon__sort(cells->lab, n, graph->key);
    }
    cells->cell_count = 0;
    cells->split_count = 0;
    clear_queue(cells);
    while (start < n) {
        uint64_t key = graph->key[cells->lab[start]];
        uint32_t end = start;

        for (; end < n && graph->key[cells->lab[end]] == key; end++)
            cells->place[cells->lab[end]] = end;
        make_cell(cells, start, end - start);
        enqueue(cells, start);
        cells->cell_count++;
        start = end;
    }
    if (graph->labelled)
        cut_by_label(cells, graph);
}

/* Uses one cell as splitter: counts for each atom its bonds of each type into the cell. */
static void split_by_cell(bs_canon_cells *cells, const bs_canon_graph *graph, uint32_t start)
{
    uint32_t size = cells->size[start];

    memcpy(cells->members, cells->lab + start, size * sizeof *cells->members);
    for (uint32_t k = 0; k < size; k++) {
        uint32_t atom = cells->members[k];
        uint32_t first = graph->offset[atom], last = graph->offset[atom + 1];

        cells->work += last - first + 1;
        for (uint32_t e = first; e < last; e++) {
            uint32_t to = graph->edge[e] >> BS_CANON_TYPE_BITS;
            uint32_t type = graph->edge[e] & ((1u << BS_CANON_TYPE_BITS) - 1);

            if (cells->size[cells->colour[to]] == 1)
                continue;
            if (cells->sum[to] == 0)
                meet(cells, to);
            /* An atom has at most 255 neighbours, so eight bits hold each count. */
            cells->sum[to] += (uint64_t)1 << 8 * type;
        }
    }
    cut_cells(cells);
}

/* Splits by the codes of the stereo elements whose ligands all differ; false if nothing split. */
static bool split_by_stereo(bs_canon_cells *cells, const bs_canon_graph *graph)
{
    uint32_t before = cells->cell_count;

    for (uint32_t k = 0; k < graph->element_count; k++) {
        const bs_canon_element *element = &graph->element[k];
        uint32_t a = element->site[0], b = element->site[element->site_count - 1];

        cells->work++;
        if (cells->size[cells->colour[a]] == 1 && cells->size[cells->colour[b]] == 1)
            continue;
        if (!bs_canon__add_code(element, cells->colour, cells->sum))
            continue;
        for (uint32_t s = 0; s < element->site_count; s++) {
            uint32_t atom = element->site[s];
            uint32_t start = cells->colour[atom];

            /* Met already if it stands among the last ones of its cell. */
            if (cells->place[atom] < start + cells->size[start] - cells->hits[start])
                meet(cells, atom);
        }
    }
    cut_cells(cells);
    return cells->cell_count > before;
}

void bs_canon__refine(bs_canon_cells *cells, const bs_canon_graph *graph)
{
    do {
        while (cells->queue_count > 0 && cells->cell_count < cells->atom_count)
            split_by_cell(cells, graph, dequeue(cells));
    } while (cells->cell_count < cells->atom_count && split_by_stereo(cells, graph));
    clear_queue(cells);
    note(cells, cells->cell_count);
}

void bs_canon__single_out(bs_canon_cells *cells, uint32_t atom)
{
    uint32_t start = cells->colour[atom], last = start + cells->size[start] - 1;

    if (last == start)
        return;
    exchange(cells, cells->place[atom], last);
    cells->size[start]--;
    cells->size[last] = 1;
    cells->colour[atom] = last;
    cells->split[cells->split_count++] = last;
    cells->cell_count++;
    enqueue(cells, last);
}

void bs_canon__set_apart(bs_canon_cells *cells, const bs_canon_element *element)
{
    uint32_t a = element->site[0], b = element->site[element->site_count - 1];
    uint32_t start = cells->colour[a], size = cells->size[start], end = start + size;

    if (a == b || cells->colour[b] != start) {
        bs_canon__single_out(cells, a);
        bs_canon__single_out(cells, b);
    } else if (size > 2) {
        exchange(cells, cells->place[a], end - 1);
        exchange(cells, cells->place[b], end - 2);
        cells->size[start] = size - 2;
        make_cell(cells, end - 2, 2);
        cells->split[cells->split_count++] = end - 2;
        cells->cell_count++;
        enqueue(cells, end - 2);
    }
}

void bs_canon__undo(bs_canon_cells *cells, uint32_t split_count)
{
    while (cells->split_count > split_count) {
        uint32_t start = cells->split[--cells->split_count];
        uint32_t into = cells->colour[cells->lab[start - 1]];

        for (uint32_t i = start; i < start + cells->size[start]; i++)
            cells->colour[cells->lab[i]] = into;
        cells->size[into] += cells->size[start];
        cells->cell_count--;
    }
}
