/*
 * How long the cheapest routes of a large random hypergraph take, and what the graph weighs. Run
 * by hand: bench_kbest [STEPS [ROUTES]]. Each line is one kind of graph.
 *
 *   plain    costs and prices drawn from the real numbers, a tenth of the steps runs backwards
 *   ties     small whole numbers, yields of 1, additive: many routes cost the same
 *   circles  half of the steps are free rearrangements of one compound into another
 *   split    one use in fifty needs fewer equivalents than the yield
 */
#include <stdio.h>
#include <stdlib.h>
#include <string.h>
#include <sys/resource.h>
#include <time.h>

#include "search/kbest.h"

#include <math.h>

typedef enum graph_kind { PLAIN, TIES, CIRCLES, SPLIT, KINDS } graph_kind;

static const char *const names[] = {"plain", "ties", "circles", "split"};

static uint64_t seed;

static double draw(void)
{
    seed = seed * 6364136223846793005u + 1442695040888963407u;
    return (double)(seed >> 11) / 9007199254740992.0;
}

static uint32_t below(uint32_t n)
{
    return (uint32_t)(draw() * n);
}

static double seconds(void)
{
    struct timespec now;

    clock_gettime(CLOCK_PROCESS_CPUTIME_ID, &now);
    return (double)now.tv_sec + 1e-9 * (double)now.tv_nsec;
}

static void must(bs_ctx *cx, bs_status st)
{
    if (st == BS_OK)
        return;
    fprintf(stderr, "%s\n", cx->error.message);
    exit(1);
}

/* Adds one step; the products are dense among the first molecules, as near a target. */
static void add_step(bs_graph *graph, graph_kind kind, uint32_t step)
{
    uint32_t n = graph->mol_count, product = step < n ? step : below(n), made;
    bool free_one = kind == CIRCLES && draw() < 0.5, back = draw() < 0.1;
    uint32_t wanted = free_one ? 1 : 1 + below(3), count = 0;
    double cost = kind == TIES ? below(4) : free_one ? 0 : 20 + 60 * draw();
    double yield = kind == TIES || free_one ? 1 : 0.6 + 0.4 * draw();
    bs_graph_part parts[3];

    for (uint32_t i = 0; i < wanted; i++) {
        uint32_t reach = 1 + product + product / 2 + 40;
        uint32_t mol = back || free_one ? below(n) : product + 1 + below(reach), j = 0;

        mol %= n;
        while (j < count && parts[j].mol != mol)
            j++;
        if (j < count || mol == product)
            continue;
        parts[count++] = (bs_graph_part){
            mol, kind == SPLIT && draw() < 0.02 ? 0.5 : 1 + (draw() < 0.2 ? draw() : 0)};
    }
    if (count > 0)
        must(graph->cx, bs_graph__add_way(graph, product, BS_GRAPH_NONE, parts, count, cost, yield,
                                          step, &made));
}

static void build(bs_graph *graph, graph_kind kind, uint32_t steps)
{
    uint32_t mols = steps / (kind == SPLIT ? 3 : 10), made;

    for (uint32_t m = 0; m < mols; m++) {
        double price = kind == TIES ? below(5) : 500 * draw() * draw();

        must(graph->cx, bs_graph__add_mol(graph, m > 20 && draw() < 0.3 ? price : INFINITY, &made));
    }
    for (uint32_t s = 0; s < steps; s++)
        add_step(graph, kind, s);
}

static void run(graph_kind kind, uint32_t steps, int wanted)
{
    bs_ctx cx;
    bs_graph graph;
    bs_kbest *kbest;
    bs_kbest_route route = {.cost = 0};
    double began, first = -1, last = 0, one = 0, longest = 0;
    bool found = true;
    int count = 0;
    size_t bytes;

    bs_ctx_init(&cx, NULL);
    bs_graph__init(&graph, &cx);
    seed = 20260101;
    build(&graph, kind, steps);
    bytes = atomic_load(&cx.own_gate.used);
    began = seconds();
    must(&cx, bs_kbest__new(&graph, kind == TIES ? BS_COST_ADDITIVE : BS_COST_PER_MOLE, 0, NULL,
                            &kbest));
    while (count < wanted) {
        must(&cx, bs_kbest__next(kbest, &found, &route));
        if (!found)
            break;
        if (count++ == 0) {
            first = route.cost;
            one = seconds() - began;
        }
        last = route.cost;
        longest = fmax(longest, route.count);
    }
    printf("%-8s %8u steps %8u molecules: %d routes in %.2f s (first %.2f s), cost %.2f to %.2f, "
           "at most %.0f steps%s; graph %.0f B a step\n",
           names[kind], graph.step_count, graph.mol_count, count, seconds() - began, one, first,
           last, longest, bs_kbest__cut(kbest) ? ", cut" : "", (double)bytes / graph.step_count);
    bs_kbest__free(kbest);
    bs_graph__free(&graph);
    bs_ctx_free(&cx);
}

int main(int argc, char **argv)
{
    uint32_t steps = argc > 1 ? (uint32_t)strtoul(argv[1], NULL, 10) : 1000000;
    int wanted = argc > 2 ? atoi(argv[2]) : 100;

    for (int kind = 0; kind < KINDS; kind++)
        run((graph_kind)kind, steps, wanted);
    return 0;
}
