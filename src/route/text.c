/* Routes as plain text: the indented tree of one, the table of many. */
#include "backsaw/route.h"

#include <math.h>
#include <stdio.h>
#include <string.h>

#define INDENT 4

/* Adds text of unknown origin; control bytes, which could steer a terminal, become '?'. */
static bs_status add_clean(bs_text *text, const char *string)
{
    bs_status st = BS_OK;

    for (const char *at = string; st == BS_OK && *at; at++) {
        unsigned char c = (unsigned char)*at;

        st = bs_text_putc(text, c < 32 || c == 127 ? '?' : *at);
    }
    return st;
}

static bs_status add_blanks(bs_text *text, int count)
{
    bs_status st = BS_OK;

    for (int i = 0; st == BS_OK && i < count; i++)
        st = bs_text_putc(text, ' ');
    return st;
}

/* ---- Tree ---------------------------------------------------------------------------------- */

/* One line that is still to be written: a molecule as a precursor of a step, at a depth. */
typedef struct pending {
    int mol;
    int depth;
    double equivalents; /* 0 for the target */
} pending;

static bs_status add_leaf(bs_text *text, const bs_route_molecule *mol)
{
    bs_status st;

    if (mol->price == 0 && !mol->offer.smiles)
        return bs_text_puts(text, "  at hand");
    st = bs_text_printf(text, "  buy, %.2f a mole", mol->price);
    if (st == BS_OK && mol->offer.code) {
        st = bs_text_puts(text, ", ");
        if (st == BS_OK)
            st = add_clean(text, mol->offer.code);
    }
    if (st == BS_OK && mol->offer.name) {
        st = bs_text_puts(text, mol->offer.code ? " " : ", ");
        if (st == BS_OK)
            st = add_clean(text, mol->offer.name);
    }
    return st;
}

/* " (clash: ketone, nitrile)" */
static bs_status add_clashes(bs_text *text, const bs_route_step *step)
{
    bs_status st = BS_OK;

    for (int i = 0; i < step->clash_count && st == BS_OK; i++) {
        st = bs_text_puts(text, i > 0 ? ", " : step->clash_count > 1 ? " (clashes: " : " (clash: ");
        if (st == BS_OK)
            st = add_clean(text, step->clashes[i]);
    }
    return st == BS_OK && step->clash_count > 0 ? bs_text_putc(text, ')') : st;
}

/* "by nitro reduction, 80-90 %: Fe, dilute acid" under the molecule that the step makes. */
static bs_status add_step(bs_text *text, const bs_route_step *step, int depth)
{
    const bs_route_way *way = &step->ways[0];
    bs_status st = add_blanks(text, depth * INDENT + 2);

    if (st == BS_OK)
        st = bs_text_puts(text, "by ");
    if (st == BS_OK)
        st = add_clean(text, way->transform ? way->transform : "a known step");
    if (st == BS_OK && way->yield_high > way->yield_low)
        st = bs_text_printf(text, ", %g-%g %%", way->yield_low, way->yield_high);
    else if (st == BS_OK)
        st = bs_text_printf(text, ", %g %%", way->yield);
    if (st == BS_OK && (way->recipe || way->conditions)) {
        st = bs_text_puts(text, ": ");
        if (st == BS_OK)
            st = add_clean(text, way->recipe ? way->recipe : way->conditions);
    }
    if (st == BS_OK && step->rival_count > 0)
        st = bs_text_printf(text, " (%d rival%s)", step->rival_count,
                            step->rival_count == 1 ? "" : "s");
    if (st == BS_OK)
        st = add_clashes(text, step);
    if (st == BS_OK && !step->checked && !step->known)
        st = bs_text_puts(text, " (not checked)");
    return st == BS_OK ? bs_text_putc(text, '\n') : st;
}

static bs_status add_molecule(bs_text *text, const bs_route *route, const pending *p, bool again)
{
    const bs_route_molecule *mol = &route->molecules[p->mol];
    bs_status st = add_blanks(text, p->depth * INDENT);

    if (st == BS_OK && p->equivalents > 0)
        st = bs_text_printf(text, "%g x ", p->equivalents);
    if (st == BS_OK)
        st = add_clean(text, mol->smiles);
    if (st == BS_OK && mol->bought)
        st = add_leaf(text, mol);
    else if (st == BS_OK)
        st = bs_text_printf(text, "  make, %.2f a mole%s", mol->cost, again ? ", as above" : "");
    return st == BS_OK ? bs_text_putc(text, '\n') : st;
}

/* Writes the molecule on top of the stack and puts what its step needs there instead. */
static bs_status unfold(bs_text *text, const bs_route *route, pending *stack, int *height,
                        bool *written)
{
    pending top = stack[--*height];
    int maker = route->molecules[top.mol].step;
    const bs_route_step *step;
    bs_status st = add_molecule(text, route, &top, written[top.mol]);

    if (st != BS_OK || maker < 0 || written[top.mol])
        return st;
    written[top.mol] = true;
    step = &route->steps[maker];
    st = add_step(text, step, top.depth);
    for (int i = step->precursor_count - 1; i >= 0; i--)
        stack[(*height)++] =
            (pending){step->precursors[i], top.depth + 1, step->ways[0].equivalents[i]};
    return st;
}

/* Whether a caution stands in an earlier step, or earlier in the same one. */
static bool is_repeated(const bs_route *route, int step, int word)
{
    const char *caution = route->steps[step].ways[0].cautions.items[word];

    for (int i = 0; i <= step; i++) {
        const bs_words *words = &route->steps[i].ways[0].cautions;

        for (int k = 0; k < (i < step ? words->count : word); k++)
            if (strcmp(words->items[k], caution) == 0)
                return true;
    }
    return false;
}

/* Each hazardous reagent once, and whose word prevails. */
static bs_status add_cautions(bs_text *text, const bs_route *route)
{
    bs_status st = BS_OK;
    bool any = false;

    for (int i = 0; i < route->step_count; i++) {
        const bs_words *words = &route->steps[i].ways[0].cautions;

        for (int k = 0; st == BS_OK && k < words->count; k++) {
            if (is_repeated(route, i, k))
                continue;
            if ((st = bs_text_puts(text, any ? ", " : "hazardous: ")) == BS_OK)
                st = add_clean(text, words->items[k]);
            any = true;
        }
    }
    if (st == BS_OK && any)
        st = bs_text_putc(text, '\n');
    if (st == BS_OK && route->step_count > 0)
        st = bs_text_puts(text, "The supplier's current safety data sheet, local rules and a risk "
                                "assessment by a competent person prevail.\n");
    return st;
}

bs_status bs_route_text(const bs_route *route, bs_text *text)
{
    bs_ctx *cx = text->cx;
    bs_mark temp = bs_arena_mark(&cx->scratch);
    size_t start = text->length, most = 1;
    int height = 0;
    pending *stack;
    bool *written;
    bs_status st;

    for (int i = 0; i < route->step_count; i++)
        most += (size_t)route->steps[i].precursor_count;
    if ((st = bs_new(cx, &cx->scratch, most, &stack)) != BS_OK ||
        (st = bs_new(cx, &cx->scratch, route->molecule_count, &written)) != BS_OK)
        goto done;
    stack[height++] = (pending){0, 0, 0};
    while (st == BS_OK && height > 0)
        st = unfold(text, route, stack, &height, written);
    if (st == BS_OK)
        st = add_cautions(text, route);
done:
    if (st != BS_OK && text->data) {
        text->length = start;
        text->data[start] = '\0';
    }
    bs_arena_rewind(&cx->scratch, temp);
    return st;
}

/* ---- Table --------------------------------------------------------------------------------- */

#define COLUMNS 7
#define CELL_MAX 64

static const char *const titles[COLUMNS] = {"no",      "cost", "steps",    "in line",
                                            "yield %", "buys", "last step"};

/* Fills the cells of one route; long names are cut. */
static void write_cells(const bs_route *route, int number, char cells[COLUMNS][CELL_MAX])
{
    const char *last = "buy it";
    bs_route_measures m;

    bs_route_measure(route, &m);
    if (route->step_count > 0) {
        last = route->steps[route->step_count - 1].ways[0].transform;
        if (!last)
            last = "a known step";
    }
    snprintf(cells[0], CELL_MAX, "%d", number);
    snprintf(cells[1], CELL_MAX, "%.2f", m.cost);
    snprintf(cells[2], CELL_MAX, "%d", m.steps);
    snprintf(cells[3], CELL_MAX, "%d", m.longest);
    if (m.yield_high - m.yield_low > 0.5)
        snprintf(cells[4], CELL_MAX, "%.0f-%.0f", m.yield_low, m.yield_high);
    else
        snprintf(cells[4], CELL_MAX, "%.0f", m.yield);
    snprintf(cells[5], CELL_MAX, "%d", m.leaves);
    snprintf(cells[6], CELL_MAX, "%s", last);
}

static bs_status add_row(bs_text *text, const char *const cells[COLUMNS], const int *width)
{
    bs_status st = BS_OK;

    for (int i = 0; st == BS_OK && i < COLUMNS; i++) {
        if (i + 1 < COLUMNS)
            st = bs_text_printf(text, "%s%*s", i ? "  " : "", width[i], cells[i]);
        else if ((st = bs_text_puts(text, "  ")) == BS_OK)
            st = add_clean(text, cells[i]);
    }
    return st == BS_OK ? bs_text_putc(text, '\n') : st;
}

static bs_status add_rows(const bs_routes *routes, bs_text *text)
{
    char cells[COLUMNS][CELL_MAX];
    const char *row[COLUMNS];
    int width[COLUMNS];
    bs_status st;

    for (int c = 0; c < COLUMNS; c++)
        width[c] = (int)strlen(titles[c]);
    for (int i = 0; i < routes->count; i++) {
        write_cells(routes->items[i], i + 1, cells);
        for (int c = 0; c < COLUMNS; c++) {
            if ((int)strlen(cells[c]) > width[c])
                width[c] = (int)strlen(cells[c]);
        }
    }
    st = add_row(text, titles, width);
    for (int i = 0; st == BS_OK && i < routes->count; i++) {
        write_cells(routes->items[i], i + 1, cells);
        for (int c = 0; c < COLUMNS; c++)
            row[c] = cells[c];
        st = add_row(text, row, width);
    }
    return st;
}

bs_status bs_routes_table(const bs_routes *routes, bs_text *text)
{
    bs_status st;

    if (routes->count == 0)
        st = bs_text_puts(text, "no route\n");
    else
        st = add_rows(routes, text);
    if (st == BS_OK && !routes->complete && routes->reason)
        st = bs_text_printf(text, "incomplete: %s\n", routes->reason);
    for (int i = 0; st == BS_OK && i < routes->warning_count; i++) {
        if ((st = bs_text_puts(text, "warning: ")) == BS_OK &&
            (st = add_clean(text, routes->warnings[i])) == BS_OK)
            st = bs_text_putc(text, '\n');
    }
    return st;
}
