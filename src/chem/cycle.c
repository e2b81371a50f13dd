/*
 * Relevant cycles of a ring system and a smallest set of smallest rings among them.
 *
 * Candidates come from shortest paths as in P. Vismara, Electron. J. Combin. 1997, 4, R9: each
 * family of relevant cycles is met once, at its last atom. Elimination over bonds (modulo 2),
 * shortest candidates first, tells which are relevant and which extend the basis. Rings are
 * looked for up to a size that doubles until the basis is complete, since in most molecules no
 * ring is large.
 */
#include "chem/ring.h"

#include <string.h>

enum {
    FIRST_SIZE = 6,
    MANY_PATHS = 64,    /* a family of more rings is represented by one */
    MAX_WORDS = 1 << 25 /* of the basis: 256 MiB */
};

/* A ring through `root` and `top`: two shortest paths that end at p and q; q is `top` if odd. */
typedef struct candidate {
    uint32_t root, top, p, q;
    uint32_t size;
    uint32_t path;   /* where its atoms stand in `path_atoms` */
    uint32_t family; /* number of rings through other shortest paths, with this one */
    uint32_t next;   /* the next candidate of the same size + 1, or 0 */
} candidate;

typedef struct cycles {
    bs_ctx *cx;
    const bs_mol *mol;
    const bs_block *block;
    uint32_t atoms, bonds, rank, words;
    uint32_t *local;   /* molecule atom to block atom + 1, 0 elsewhere; lent by the caller */
    uint32_t *global;  /* block atom to molecule atom */
    uint32_t *offsets; /* adjacency within the block */
    bs_link *links;
    /* The walk from one root. */
    uint32_t *distance; /* UINT32_MAX where not reached */
    uint32_t *before;   /* the atom before on the path, over atoms below the root only */
    bool *low;          /* whether there is such a path */
    uint32_t *ways;     /* how many there are, up to MANY_PATHS + 1 */
    uint32_t *queue;
    uint32_t *stamp; /* for the test whether two paths meet */
    uint32_t clock;
    /* Candidates. */
    candidate *list;
    uint32_t count, room;
    uint32_t *first, *last; /* by size: candidate + 1, or 0 */
    uint32_t *path_atoms;
    uint32_t path_count, path_room;
    /* Elimination. */
    uint64_t *rows;
    uint32_t *pivot; /* row + 1 whose lowest bond this is */
    uint64_t *vector, *spare;
    uint32_t row_count;
} cycles;

/* ---- The block as a graph of its own ------------------------------------------------------ */

/* Numbers the atoms of the block in the order of its bonds and counts their neighbours. */
static void number_atoms(cycles *c)
{
    const bs_bond *bonds = bs_mol__bonds(c->mol);
    uint32_t next = 0;

    for (uint32_t i = 0; i < c->bonds; i++) {
        const bs_bond *b = &bonds[c->block->bonds[i]];
        uint32_t ends[2] = {b->a, b->b};

        for (int k = 0; k < 2; k++) {
            if (c->local[ends[k]] == 0) {
                c->global[next] = ends[k];
                c->local[ends[k]] = ++next;
            }
            c->offsets[c->local[ends[k]]]++;
        }
    }
    for (uint32_t i = 0; i < c->atoms; i++)
        c->offsets[i + 1] += c->offsets[i];
}

static bs_status build_graph(cycles *c)
{
    const bs_bond *bonds = bs_mol__bonds(c->mol);
    bs_arena *scratch = &c->cx->scratch;
    uint32_t *fill;
    bs_status st;

    if ((st = bs_new(c->cx, scratch, c->atoms, &c->global)) != BS_OK ||
        (st = bs_new(c->cx, scratch, c->atoms + 1, &c->offsets)) != BS_OK ||
        (st = bs_new(c->cx, scratch, c->atoms, &fill)) != BS_OK ||
        (st = bs_new(c->cx, scratch, 2 * (size_t)c->bonds, &c->links)) != BS_OK)
        return st;
    number_atoms(c);
    for (uint32_t i = 0; i < c->bonds; i++) {
        uint32_t a = c->local[bonds[c->block->bonds[i]].a] - 1;
        uint32_t b = c->local[bonds[c->block->bonds[i]].b] - 1;

        c->links[c->offsets[a] + fill[a]++] = (bs_link){b, i};
        c->links[c->offsets[b] + fill[b]++] = (bs_link){a, i};
    }
    for (uint32_t i = 0; i < c->atoms; i++)
        c->local[c->global[i]] = 0;
    return BS_OK;
}

/* ---- Candidates --------------------------------------------------------------------------- */

/* Shortest distances from `root` up to `depth`; returns how many atoms are in the queue. */
static uint32_t walk(cycles *c, uint32_t root, uint32_t depth)
{
    uint32_t head = 0;
    uint32_t tail = 0;

    c->queue[tail++] = root;
    c->distance[root] = 0;
    while (head < tail) {
        uint32_t v = c->queue[head++];

        if (c->distance[v] == depth)
            break;
        for (uint32_t k = c->offsets[v]; k < c->offsets[v + 1]; k++) {
            uint32_t w = c->links[k].atom;

            if (c->distance[w] == UINT32_MAX) {
                c->distance[w] = c->distance[v] + 1;
                c->low[w] = false;
                c->ways[w] = 0;
                c->queue[tail++] = w;
            }
            if (w >= root || c->distance[w] != c->distance[v] + 1 || (v != root && !c->low[v]))
                continue;
            if (!c->low[w])
                c->before[w] = v;
            c->low[w] = true;
            c->ways[w] += v == root ? 1 : c->ways[v];
            if (c->ways[w] > MANY_PATHS)
                c->ways[w] = MANY_PATHS + 1;
        }
    }
    return tail;
}

/* Whether the paths from the root to p and to q share only the root. */
static bool paths_are_apart(cycles *c, uint32_t root, uint32_t p, uint32_t q)
{
    c->clock++;
    for (; p != root; p = c->before[p])
        c->stamp[p] = c->clock;
    for (; q != root; q = c->before[q]) {
        if (c->stamp[q] == c->clock)
            return false;
    }
    return true;
}

/* Doubles an array in the scratch arena. */
static bs_status double_room(cycles *c, void *array, uint32_t count, uint32_t *room, size_t size)
{
    uint32_t wanted = *room ? *room * 2 : 64;
    void *old;
    void *block;
    bs_status st;

    if (*room > UINT32_MAX / 4)
        return bs_fail(c->cx, BS_ELIMIT, "a ring system with too many rings");
    if ((st = bs_new_array(c->cx, &c->cx->scratch, wanted, size, &block)) != BS_OK)
        return st;
    memcpy(&old, array, sizeof old);
    if (count > 0)
        memcpy(block, old, count * size);
    memcpy(array, &block, sizeof block);
    *room = wanted;
    return BS_OK;
}

/* Writes the ring down in order: root, path to p, [top], path back from q. */
static bs_status keep_candidate(cycles *c, candidate found)
{
    uint32_t at;
    bs_status st;

    while (c->path_count + found.size > c->path_room) {
        st = double_room(c, &c->path_atoms, c->path_count, &c->path_room, sizeof(uint32_t));
        if (st != BS_OK)
            return st;
    }
    if (c->count == c->room &&
        (st = double_room(c, &c->list, c->count, &c->room, sizeof(candidate))) != BS_OK)
        return st;
    found.path = c->path_count;
    found.family = c->ways[found.p] * c->ways[found.q];
    at = c->path_count + c->distance[found.p];
    for (uint32_t v = found.p; v != found.root; v = c->before[v])
        c->path_atoms[at--] = v;
    c->path_atoms[at] = found.root;
    at = c->path_count + c->distance[found.p] + 1;
    if (found.q != found.top)
        c->path_atoms[at++] = found.top;
    for (uint32_t v = found.q; v != found.root; v = c->before[v])
        c->path_atoms[at++] = v;
    c->path_count += found.size;
    c->list[c->count++] = found;
    if (c->first[found.size] == 0)
        c->first[found.size] = c->count;
    else
        c->list[c->last[found.size] - 1].next = c->count;
    c->last[found.size] = c->count;
    return BS_OK;
}

/* The candidates whose far end is `y`. */
static bs_status candidates_at(cycles *c, uint32_t root, uint32_t y, uint32_t limit)
{
    uint32_t d = c->distance[y];
    bs_status st = BS_OK;

    for (uint32_t k = c->offsets[y]; k < c->offsets[y + 1] && st == BS_OK; k++) {
        uint32_t z = c->links[k].atom;

        if (z >= root || c->distance[z] == UINT32_MAX || !c->low[z])
            continue;
        if (c->distance[z] == d && z < y && 2 * d + 1 <= limit) {
            if (paths_are_apart(c, root, z, y))
                st = keep_candidate(c, (candidate){root, y, z, y, 2 * d + 1, 0, 0, 0});
        } else if (c->distance[z] + 1 == d && 2 * d <= limit) {
            for (uint32_t j = c->offsets[y]; j < k && st == BS_OK; j++) {
                uint32_t w = c->links[j].atom;

                if (w >= root || c->distance[w] + 1 != d || !c->low[w])
                    continue;
                if (paths_are_apart(c, root, w, z))
                    st = keep_candidate(c, (candidate){root, y, w, z, 2 * d, 0, 0, 0});
            }
        }
    }
    return st;
}

/* The last atom of a ring has two neighbours before it; atoms that lack them need no walk. */
static bool can_be_last(const cycles *c, uint32_t atom)
{
    uint32_t before = 0;

    for (uint32_t k = c->offsets[atom]; k < c->offsets[atom + 1]; k++)
        before += c->links[k].atom < atom;
    return before >= 2;
}

static bs_status collect(cycles *c, uint32_t limit)
{
    bs_status st = BS_OK;

    c->count = 0;
    c->path_count = 0;
    memset(c->first, 0, (c->atoms + 1) * sizeof *c->first);
    for (uint32_t root = 2; root < c->atoms && st == BS_OK; root++) {
        uint32_t reached;

        if (!can_be_last(c, root))
            continue;
        reached = walk(c, root, limit / 2);
        for (uint32_t i = 1; i < reached && st == BS_OK; i++) {
            if (c->low[c->queue[i]])
                st = candidates_at(c, root, c->queue[i], limit);
        }
        for (uint32_t i = 0; i < reached; i++)
            c->distance[c->queue[i]] = UINT32_MAX;
        if (st == BS_OK)
            st = bs_poll(c->cx);
    }
    return st;
}

/* ---- Elimination -------------------------------------------------------------------------- */

static uint32_t bond_between(const cycles *c, uint32_t a, uint32_t b)
{
    uint32_t k = c->offsets[a];

    while (c->links[k].atom != b)
        k++;
    return c->links[k].bond;
}

static void load_vector(cycles *c, const candidate *ring)
{
    const uint32_t *atoms = c->path_atoms + ring->path;

    memset(c->vector, 0, c->words * sizeof *c->vector);
    for (uint32_t i = 0; i < ring->size; i++) {
        uint32_t bond = bond_between(c, atoms[i], atoms[i + 1 < ring->size ? i + 1 : 0]);

        c->vector[bond / 64] |= (uint64_t)1 << bond % 64;
    }
}

/*
 * Reduces the vector by the first `rows` rows. Returns the lowest bond left, or UINT32_MAX if
 * the vector is a sum of rows.
 */
static uint32_t reduce(cycles *c, uint32_t rows)
{
    for (uint32_t w = 0; w < c->words; w++) {
        while (c->vector[w] != 0) {
            uint32_t bond = w * 64 + (uint32_t)__builtin_ctzll(c->vector[w]);
            uint32_t row = c->pivot[bond];
            const uint64_t *from;

            if (row == 0 || row > rows)
                return bond;
            from = c->rows + (size_t)(row - 1) * c->words;
            for (uint32_t i = w; i < c->words; i++)
                c->vector[i] ^= from[i];
        }
    }
    return UINT32_MAX;
}

static bs_status emit(cycles *c, const candidate *ring, bs_rings *into)
{
    uint32_t *atoms;
    bs_status st = bs_ring__add(into, ring->size, &atoms);

    for (uint32_t i = 0; i < ring->size && st == BS_OK; i++)
        atoms[i] = c->global[c->path_atoms[ring->path + i]];
    return st;
}

/* The `way`-th path from the root to `v`, written backwards from `to`. */
static void write_way(const cycles *c, uint32_t root, uint32_t v, uint32_t way, uint32_t *to,
                      int step)
{
    while (v != root) {
        uint32_t k = c->offsets[v];

        *to = c->global[v];
        to += step;
        if (c->distance[v] == 1)
            return;
        for (;; k++) {
            uint32_t w = c->links[k].atom;

            if (w >= root || c->distance[w] + 1 != c->distance[v] || !c->low[w])
                continue;
            if (way < c->ways[w])
                break;
            way -= c->ways[w];
        }
        v = c->links[k].atom;
    }
}

/*
 * Adds the other rings of a family: those that go through other shortest paths. They are as
 * relevant as the candidate, and which of them that is depends on the numbers of the atoms.
 */
static bs_status emit_family(cycles *c, const candidate *ring, bs_rings *more)
{
    uint32_t reached;
    bs_status st = BS_OK;

    if (ring->family < 2 || ring->family > MANY_PATHS)
        return BS_OK;
    reached = walk(c, ring->root, ring->size / 2);
    for (uint32_t i = 0; i < ring->family && st == BS_OK; i++) {
        uint32_t d = c->distance[ring->p];
        uint32_t *atoms;
        bool known = true;

        if ((st = bs_ring__add(more, ring->size, &atoms)) != BS_OK)
            break;
        atoms[0] = c->global[ring->root];
        write_way(c, ring->root, ring->p, i % c->ways[ring->p], atoms + d, -1);
        if (ring->q != ring->top)
            atoms[d + 1] = c->global[ring->top];
        write_way(c, ring->root, ring->q, i / c->ways[ring->p],
                  atoms + d + (ring->q != ring->top ? 2 : 1), 1);
        for (uint32_t k = 0; k < ring->size; k++)
            known = known && atoms[k] == c->global[c->path_atoms[ring->path + k]];
        more->count -= known;
    }
    for (uint32_t i = 0; i < reached; i++)
        c->distance[c->queue[i]] = UINT32_MAX;
    return st;
}

/* Tests one candidate; `shorter` rows come from shorter rings. */
static bs_status consider(cycles *c, const candidate *ring, uint32_t shorter, bs_rings *set,
                          bs_rings *more)
{
    uint32_t bond;
    bs_status st;

    load_vector(c, ring);
    if (reduce(c, shorter) == UINT32_MAX)
        return BS_OK;
    if ((st = emit_family(c, ring, more)) != BS_OK)
        return st;
    bond = reduce(c, c->row_count);
    if (bond == UINT32_MAX)
        return emit(c, ring, more);
    memcpy(c->rows + (size_t)c->row_count * c->words, c->vector, c->words * sizeof *c->vector);
    c->pivot[bond] = ++c->row_count;
    return emit(c, ring, set);
}

static bs_status eliminate(cycles *c, uint32_t limit, bs_rings *set, bs_rings *more)
{
    bs_status st = BS_OK;

    memset(c->pivot, 0, c->bonds * sizeof *c->pivot);
    c->row_count = 0;
    for (uint32_t size = 3; size <= limit && c->row_count < c->rank && st == BS_OK; size++) {
        uint32_t shorter = c->row_count;

        for (uint32_t i = c->first[size]; i != 0 && st == BS_OK; i = c->list[i - 1].next)
            st = consider(c, &c->list[i - 1], shorter, set, more);
        if (st == BS_OK)
            st = bs_poll(c->cx);
    }
    return st;
}

/* ---- All together ------------------------------------------------------------------------- */

static bs_status prepare(cycles *c)
{
    bs_arena *scratch = &c->cx->scratch;
    bs_status st;

    c->words = (c->bonds + 63) / 64;
    if ((uint64_t)c->words * c->rank > MAX_WORDS)
        return bs_fail(c->cx, BS_ELIMIT, "a ring system of %lu rings is too large",
                       (unsigned long)c->rank);
    if ((st = build_graph(c)) != BS_OK ||
        (st = bs_new(c->cx, scratch, c->atoms, &c->distance)) != BS_OK ||
        (st = bs_new(c->cx, scratch, c->atoms, &c->before)) != BS_OK ||
        (st = bs_new(c->cx, scratch, c->atoms, &c->low)) != BS_OK ||
        (st = bs_new(c->cx, scratch, c->atoms, &c->ways)) != BS_OK ||
        (st = bs_new(c->cx, scratch, c->atoms, &c->queue)) != BS_OK ||
        (st = bs_new(c->cx, scratch, c->atoms, &c->stamp)) != BS_OK ||
        (st = bs_new(c->cx, scratch, c->atoms + 1, &c->first)) != BS_OK ||
        (st = bs_new(c->cx, scratch, c->atoms + 1, &c->last)) != BS_OK ||
        (st = bs_new(c->cx, scratch, c->bonds, &c->pivot)) != BS_OK ||
        (st = bs_new(c->cx, scratch, c->words, &c->vector)) != BS_OK ||
        (st = bs_new(c->cx, scratch, (size_t)c->words * c->rank, &c->rows)) != BS_OK)
        return st;
    memset(c->distance, 0xff, c->atoms * sizeof *c->distance);
    return BS_OK;
}

bs_status bs_cycle__find(bs_ctx *cx, const bs_mol *mol, const bs_block *block, uint32_t *local,
                         bs_rings *set, bs_rings *more)
{
    cycles c = {.cx = cx, .mol = mol, .block = block, .local = local};
    uint32_t set_count = set->count;
    uint32_t more_count = more->count;
    bs_status st;

    c.atoms = block->atom_count;
    c.bonds = block->bond_count;
    c.rank = c.bonds - c.atoms + 1;
    st = prepare(&c);
    for (uint32_t limit = FIRST_SIZE; st == BS_OK && c.row_count < c.rank; limit *= 2) {
        set->count = set_count; /* forget what a smaller limit gave */
        more->count = more_count;
        if (limit > c.atoms)
            limit = c.atoms;
        if ((st = collect(&c, limit)) == BS_OK)
            st = eliminate(&c, limit, set, more);
        if (st == BS_OK && limit == c.atoms && c.row_count < c.rank)
            st = bs_fail(cx, BS_EBUG, "the rings of a ring system were not found");
    }
    return st;
}
