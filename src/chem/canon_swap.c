/* Proves two atoms alike by exchanging what hangs on them; see chem/canon.h. */
#include "chem/canon.h"

#include <string.h>

/* One attempt: the images found so far, and the colourings they have to respect. */
typedef struct attempt {
    bs_canon_swap *swap;
    const bs_canon_graph *graph;
    const uint32_t *before;
    const uint32_t *after;
} attempt;

bs_status bs_canon__swap_new(bs_ctx *cx, uint32_t atom_count, bs_canon_swap *swap)
{
    bs_status st;

    memset(swap, 0, sizeof *swap);
    if ((st = bs_new(cx, &cx->scratch, atom_count, &swap->image)) != BS_OK ||
        (st = bs_new(cx, &cx->scratch, atom_count, &swap->met)) != BS_OK)
        return st;
    memset(swap->image, 0xFF, atom_count * sizeof *swap->image);
    return BS_OK;
}

void bs_canon__swap_clear(bs_canon_swap *swap)
{
    for (uint32_t k = 0; k < swap->met_count; k++)
        swap->image[swap->met[k]] = BS_CANON_NONE;
    swap->met_count = 0;
}

static void set_image(bs_canon_swap *swap, uint32_t atom, uint32_t image)
{
    swap->image[atom] = image;
    swap->met[swap->met_count++] = atom;
}

static inline uint32_t image_of(const bs_canon_swap *swap, uint32_t atom)
{
    return swap->image[atom] == BS_CANON_NONE ? atom : swap->image[atom];
}

/* Whether a and b may be exchanged as far as the colours tell. */
static bool may_exchange(const attempt *try, uint32_t a, uint32_t b)
{
    return try->after[b] == try->before[a] && try->before[b] == try->after[a];
}

static bool has_edge(const bs_canon_graph *graph, uint32_t from, uint32_t edge)
{
    for (uint32_t e = graph->offset[from]; e < graph->offset[from + 1]; e++)
        if (graph->edge[e] == edge)
            return true;
    return false;
}

/*
 * Finds an image for the neighbour behind `edge` of an atom that moves to `target`: itself if it
 * can stay, else a neighbour of the target to be exchanged with.
 */
static bool place_neighbour(attempt *try, uint32_t edge, uint32_t target)
{
    const bs_canon_graph *graph = try->graph;
    uint32_t atom = edge >> BS_CANON_TYPE_BITS;

    if (try->before[atom] == try->after[atom] && has_edge(graph, target, edge)) {
        set_image(try->swap, atom, atom);
        return true;
    }
    for (uint32_t e = graph->offset[target]; e < graph->offset[target + 1]; e++) {
        uint32_t other = graph->edge[e] >> BS_CANON_TYPE_BITS;

        try->swap->work++;
        /* The two edges are of one type if they differ in the atom only. */
        if (other == atom || try->swap->image[other] != BS_CANON_NONE ||
            (graph->edge[e] ^ edge) & ((1u << BS_CANON_TYPE_BITS) - 1) ||
            !may_exchange(try, atom, other))
            continue;
        set_image(try->swap, atom, other);
        set_image(try->swap, other, atom);
        return true;
    }
    return false;
}

/* Carries the exchange from atom to atom until nothing more has to move. */
static bool spread(attempt *try)
{
    const bs_canon_graph *graph = try->graph;

    for (uint32_t k = 0; k < try->swap->met_count; k++) {
        uint32_t atom = try->swap->met[k], target = try->swap->image[atom];

        if (target == atom)
            continue;
        for (uint32_t e = graph->offset[atom]; e < graph->offset[atom + 1]; e++) {
            try->swap->work++;
            if (try->swap->image[graph->edge[e] >> BS_CANON_TYPE_BITS] == BS_CANON_NONE &&
                !place_neighbour(try, graph->edge[e], target))
                return false;
        }
    }
    return true;
}

static bool keeps_bonds(const attempt *try)
{
    const bs_canon_graph *graph = try->graph;

    for (uint32_t k = 0; k < try->swap->met_count; k++) {
        uint32_t atom = try->swap->met[k], target = try->swap->image[atom];

        if (target == atom)
            continue;
        if (graph->key[atom] != graph->key[target])
            return false;
        for (uint32_t e = graph->offset[atom]; e < graph->offset[atom + 1]; e++) {
            uint32_t to = image_of(try->swap, graph->edge[e] >> BS_CANON_TYPE_BITS);
            uint32_t type = graph->edge[e] & ((1u << BS_CANON_TYPE_BITS) - 1);

            if (!has_edge(graph, target, to << BS_CANON_TYPE_BITS | type))
                return false;
        }
    }
    return true;
}

/* ---- Stereo ---------------------------------------------------------------------------- */

/* The elements under the exchange are compared by listing their ligands by number of the image. */
static bs_canon_element moved(const bs_canon_swap *swap, const bs_canon_element *element)
{
    bs_canon_element out = *element;

    for (uint32_t s = 0; s < out.site_count; s++)
        out.site[s] = image_of(swap, out.site[s]);
    for (uint32_t k = 0; k < out.ligand_count; k++)
        if (bs_canon__is_atom(out.ligand[k]))
            out.ligand[k] = image_of(swap, out.ligand[k]);
    return out;
}

static bool is_touched(const bs_canon_swap *swap, const bs_canon_element *element)
{
    for (uint32_t s = 0; s < element->site_count; s++)
        if (image_of(swap, element->site[s]) != element->site[s])
            return true;
    for (uint32_t k = 0; k < element->ligand_count; k++)
        if (bs_canon__is_atom(element->ligand[k]) &&
            image_of(swap, element->ligand[k]) != element->ligand[k])
            return true;
    return false;
}

static bool same_sites(const bs_canon_element *a, const bs_canon_element *b)
{
    if (a->kind != b->kind || a->perm == 0 || b->perm == 0)
        return false;
    if (a->site_count == 1)
        return a->site[0] == b->site[0];
    return (a->site[0] == b->site[0] && a->site[1] == b->site[1]) ||
           (a->site[0] == b->site[1] && a->site[1] == b->site[0]);
}

/* Whether the graph has an element as `element` is after the exchange. `number` colours atoms. */
static bool has_element(const bs_canon_graph *graph, const bs_canon_element *element,
                        const uint32_t *number)
{
    uint32_t link = graph->element_head[element->site[0]];

    for (; link != BS_CANON_NONE; link = graph->element_next[link]) {
        const bs_canon_element *other = &graph->element[link / 2];

        if (same_sites(element, other))
            return bs_canon__code(element, number) == bs_canon__code(other, number);
    }
    return false;
}

static bool keeps_stereo(const attempt *try)
{
    const bs_canon_graph *graph = try->graph;

    for (uint32_t k = 0; k < graph->element_count; k++) {
        const bs_canon_element *element = &graph->element[k];
        bs_canon_element image;

        try->swap->work++;
        if (element->perm == 0 || !is_touched(try->swap, element))
            continue;
        image = moved(try->swap, element);
        if (!has_element(graph, &image, graph->number))
            return false;
    }
    return true;
}

bool bs_canon__swap_find(bs_canon_swap *swap, const bs_canon_graph *graph, const uint32_t *before,
                         const uint32_t *after, uint32_t v, uint32_t w)
{
    attempt try = {swap, graph, before, after};

    if (!may_exchange(&try, v, w))
        return false;
    set_image(swap, v, w);
    set_image(swap, w, v);
    return spread(&try) && keeps_bonds(&try) && keeps_stereo(&try);
}
