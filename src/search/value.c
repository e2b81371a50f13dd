/* The algorithm of value.h: a molecule is in the heap while `value` and `now` differ. */
#include "search/value.h"

#include <math.h>

void bs_values__init(bs_values *values, const bs_graph *graph, bs_cost_mode mode, bool counts)
{
    *values = (bs_values){.graph = graph, .mode = mode, .counts = counts};
}

void bs_values__free(bs_values *values)
{
    if (!values->graph)
        return;
    bs_gate_free(values->graph->cx->gate, values->items, values->room * sizeof *values->items);
    bs_heap__free(&values->heap, values->graph->cx);
    *values = (bs_values){.graph = NULL};
}

double bs_values__cost(const bs_values *values, uint32_t way)
{
    const bs_graph_way *w = &values->graph->ways[way];
    const bs_graph_use *uses = &values->graph->uses[w->first];
    bool moles = values->mode == BS_COST_PER_MOLE && !values->counts;
    double sum = values->counts ? 0 : w->cost, most = 0;

    for (uint32_t i = 0; i < w->count; i++) {
        double value = values->items[uses[i].mol].value;

        sum += moles ? uses[i].equivalents * value : value;
        if (value > most)
            most = value;
    }
    if (moles)
        sum /= w->yield;
    return sum > most ? sum : nextafter(most, INFINITY);
}

/* Puts a molecule into the heap if it is not settled. */
static bs_status note(bs_values *values, uint32_t mol)
{
    const bs_value *v = &values->items[mol];

    if (v->now == v->value)
        return BS_OK;
    return bs_heap__push(&values->heap, values->graph->cx, fmin(v->now, v->value), mol);
}

/* Works out anew what the ways and the leaf of a molecule give. */
static bs_status look_again(bs_values *values, uint32_t mol)
{
    const bs_graph *graph = values->graph;
    bs_value *v = &values->items[mol];

    v->now = v->leaf;
    v->choice = isfinite(v->leaf) ? BS_GRAPH_BUY : BS_GRAPH_NONE;
    for (uint32_t w = graph->mols[mol].first_way; w != BS_GRAPH_NONE && w < values->ways;
         w = graph->ways[w].next) {
        double cost = bs_values__cost(values, w);

        if (!(cost < v->now))
            continue;
        v->now = cost;
        v->choice = w;
    }
    return note(values, mol);
}

static bs_status offer(bs_values *values, uint32_t way)
{
    uint32_t mol = values->graph->ways[way].product;
    bs_value *v = &values->items[mol];
    double cost = bs_values__cost(values, way);

    if (!(cost < v->now))
        return BS_OK;
    v->now = cost;
    v->choice = way;
    return note(values, mol);
}

bs_status bs_values__grow(bs_values *values)
{
    const bs_graph *graph = values->graph;
    bs_status st = bs_graph__reserve(graph->cx, &values->items, &values->room, graph->mol_count,
                                     sizeof *values->items);
    double price;

    for (; st == BS_OK && values->mols < graph->mol_count; values->mols++) {
        values->items[values->mols] = (bs_value){
            .value = INFINITY, .now = INFINITY, .leaf = INFINITY, .choice = BS_GRAPH_NONE};
        price = graph->mols[values->mols].price;
        st = bs_values__set_leaf(values, values->mols,
                                 values->counts && isfinite(price) ? 0 : price);
    }
    while (st == BS_OK && values->ways < graph->way_count)
        st = offer(values, values->ways++);
    return st;
}

bs_status bs_values__set_leaf(bs_values *values, uint32_t mol, double leaf)
{
    bs_value *v = &values->items[mol];
    bool was_chosen = v->choice == BS_GRAPH_BUY;
    double before = v->leaf;

    v->leaf = leaf;
    if (leaf == before || (!was_chosen && leaf >= v->now))
        return BS_OK;
    return look_again(values, mol);
}

/* The ways that use a molecule may have become cheaper. */
static bs_status spread_fall(bs_values *values, uint32_t mol)
{
    const bs_graph *graph = values->graph;
    bs_status st = BS_OK;

    for (uint32_t use = graph->mols[mol].first_use; st == BS_OK && use != BS_GRAPH_NONE;
         use = graph->uses[use].next) {
        if (graph->uses[use].way < values->ways)
            st = offer(values, graph->uses[use].way);
    }
    return st;
}

/* Those that were chosen for this molecule's value have lost it. */
static bs_status spread_rise(bs_values *values, uint32_t mol)
{
    const bs_graph *graph = values->graph;
    bs_status st = note(values, mol);

    for (uint32_t use = graph->mols[mol].first_use; st == BS_OK && use != BS_GRAPH_NONE;
         use = graph->uses[use].next) {
        uint32_t way = graph->uses[use].way, product = graph->ways[way].product;

        if (values->items[product].choice == way)
            st = look_again(values, product);
    }
    return st;
}

bs_status bs_values__settle(bs_values *values)
{
    bs_status st = BS_OK;

    while (st == BS_OK && values->heap.count > 0) {
        bs_heap_entry top = bs_heap__pop(&values->heap);
        bs_value *v = &values->items[top.item];

        if (v->now == v->value || top.key != fmin(v->now, v->value))
            continue; /* it was settled, or is in the heap with another key */
        values->spread++;
        if (v->now < v->value) {
            v->value = v->now;
            st = spread_fall(values, top.item);
        } else {
            v->value = INFINITY;
            st = spread_rise(values, top.item);
        }
    }
    return st;
}
