/* From a query to a program: expressions, masks of bonds, the order of visits, stereo checks. */
#include "match/program.h"

#include <string.h>

/* An expression nested deeper than this is refused; generating code recurses on it. */
#define MAX_NESTING 400

/* ---- Expressions ----------------------------------------------------------------------- */

typedef struct generator {
    bs_ctx *cx;
    const bs_query_expr *expr;
    const int *size;
    const int *sub_number; /* recursive part of the query -> of the whole pattern */
    bs_code *code;
    int count;
} generator;

/* Generates the tree that ends at test `at`, backwards, so that jumps go to what is there. */
static bs_status generate(generator *g, int at, int yes, int no, int depth, int *entry)
{
    const bs_test *test = &g->expr->tests[at];
    int right = at - 1, second;
    bs_status st;

    if (depth > MAX_NESTING)
        return bs_fail(g->cx, BS_ELIMIT, "an expression of the pattern is nested too deep");
    if (test->kind == BS_TEST_NOT)
        return generate(g, right, no, yes, depth + 1, entry);
    if (test->kind == BS_TEST_AND || test->kind == BS_TEST_OR) {
        bool both = test->kind == BS_TEST_AND;

        if ((st = generate(g, right, yes, no, depth + 1, &second)) != BS_OK)
            return st;
        return generate(g, right - g->size[right], both ? second : yes, both ? no : second,
                        depth + 1, entry);
    }
    *entry = g->count;
    g->code[g->count++] = (bs_code){
        .kind = test->kind,
        .value = test->kind == BS_TEST_RECURSE ? (int16_t)g->sub_number[test->value] : test->value,
        .yes = yes,
        .no = no,
    };
    return BS_OK;
}

static bs_status compile_expr(bs_ctx *cx, bs_arena *home, const bs_query_expr *expr,
                              const int *sub_number, bs_program_expr *out)
{
    bs_mark mark = bs_arena_mark(&cx->scratch);
    generator g = {.cx = cx, .expr = expr, .sub_number = sub_number};
    int *size;
    bs_status st = bs_query_sizes(cx, &cx->scratch, expr, &size);

    if (st == BS_OK)
        st = bs_new(cx, home, expr->count, &g.code);
    if (st == BS_OK) {
        g.size = size;
        st = generate(&g, expr->count - 1, BS_CODE_PASS, BS_CODE_FAIL, 0, &out->entry);
        out->code = g.code;
    }
    bs_arena_rewind(&cx->scratch, mark);
    return st;
}

/* ---- Order of visits ------------------------------------------------------------------- */

/* How much a test narrows the choice; elements that are rare in organic molecules narrow most. */
static int test_weight(const bs_test *test)
{
    switch (test->kind) {
    case BS_TEST_ELEMENT:
    case BS_TEST_ALIPHATIC_ELEM:
    case BS_TEST_AROMATIC_ELEM:
        return test->value == 6 ? 2 : test->value == 8 || test->value == 7 ? 8 : 16;
    case BS_TEST_CHARGE:
        return test->value != 0 ? 12 : 0;
    case BS_TEST_ISOTOPE:
        return 20;
    case BS_TEST_RECURSE:
        return 3;
    case BS_TEST_ANY:
        return 0;
    default:
        return 1;
    }
}

static int atom_weight(const bs_query_expr *expr)
{
    int weight = 0;

    for (int i = 0; i < expr->count; i++) {
        int kind = expr->tests[i].kind, value;

        if (kind > BS_TEST_OR && bs_query_demands(expr, (bs_test_kind)kind, &value))
            weight += test_weight(&expr->tests[i]);
    }
    return weight;
}

typedef struct planner {
    const bs_query *query;
    bs_pattern *pattern;
    int *weight;
    bool *placed;
    int visit_count, closure_count;
} planner;

/* Puts an atom at the end of the order, with its bonds to atoms that are there. */
static void place(planner *p, int atom)
{
    bs_visit *visit = &p->pattern->visits[p->visit_count++];

    *visit = (bs_visit){.atom = atom,
                        .parent = -1,
                        .first_closure = p->closure_count,
                        .group = p->query->atoms[atom].component};
    for (int i = 0; i < p->query->bond_count; i++) {
        const bs_query_bond *bond = &p->query->bonds[i];
        int other = bond->a == atom ? bond->b : bond->a;

        if ((bond->a != atom && bond->b != atom) || !p->placed[other])
            continue;
        if (visit->parent < 0) {
            visit->parent = other;
            visit->bond_mask = p->pattern->bond_masks[i];
        } else {
            p->pattern->closures[p->closure_count++] =
                (bs_closure){other, p->pattern->bond_masks[i]};
            visit->closure_count++;
        }
    }
    p->placed[atom] = true;
}

/* The heaviest atom that hangs on one that is placed; -1 if there is none. */
static int next_neighbour(const planner *p)
{
    int best = -1;

    for (int i = 0; i < p->query->bond_count; i++) {
        int a = p->query->bonds[i].a, b = p->query->bonds[i].b;
        int open = p->placed[a] && !p->placed[b] ? b : p->placed[b] && !p->placed[a] ? a : -1;

        if (open >= 0 && (best < 0 || p->weight[open] > p->weight[best] ||
                          (p->weight[open] == p->weight[best] && open < best)))
            best = open;
    }
    return best;
}

static int heaviest(const planner *p)
{
    int best = -1;

    for (int i = 0; i < p->query->atom_count; i++)
        if (!p->placed[i] && (best < 0 || p->weight[i] > p->weight[best]))
            best = i;
    return best;
}

/* A recursive part starts with its first atom, which the outer atom stands for. */
static bs_status plan_visits(bs_ctx *cx, bs_arena *home, bs_pattern *pattern, bool recursive)
{
    const bs_query *query = pattern->query;
    bs_mark mark = bs_arena_mark(&cx->scratch);
    planner p = {.query = query, .pattern = pattern};
    bs_status st = bs_new(cx, home, query->atom_count, &pattern->visits);

    if (st == BS_OK)
        st = bs_new(cx, home, query->bond_count, &pattern->closures);
    if (st == BS_OK)
        st = bs_new(cx, &cx->scratch, query->atom_count, &p.weight);
    if (st == BS_OK)
        st = bs_new(cx, &cx->scratch, query->atom_count, &p.placed);
    for (int i = 0; st == BS_OK && i < query->atom_count; i++)
        p.weight[i] = atom_weight(&query->atoms[i].expr);
    while (st == BS_OK && p.visit_count < query->atom_count) {
        int atom = next_neighbour(&p);

        if (atom < 0)
            atom = recursive && p.visit_count == 0 ? 0 : heaviest(&p);
        place(&p, atom);
    }
    bs_arena_rewind(&cx->scratch, mark);
    return st;
}

/* ---- Stereo ---------------------------------------------------------------------------- */

static bs_status plan_hands(bs_ctx *cx, bs_arena *home, bs_pattern *pattern, const int *sub_number)
{
    const bs_query *query = pattern->query;
    bs_status st = bs_new(cx, home, query->atom_count, &pattern->hands);

    for (int i = 0; st == BS_OK && i < query->atom_count; i++) {
        bs_hand_check *check = &pattern->hands[pattern->hand_count];

        if (!bs_query_mentions(&query->atoms[i].expr, BS_TEST_CHIRAL))
            continue;
        check->atom = i;
        st = compile_expr(cx, home, &query->atoms[i].expr, sub_number, &check->whole);
        pattern->hand_count++;
    }
    return st;
}

/*
 * How a bond leaves `from`: 1 up, -1 down, 0 without direction. '/' goes up from its first atom,
 * so seen from the second it goes down.
 */
static int direction(const bs_query_bond *bond, int from, bool *or_none)
{
    int value, up = 0;

    if (bs_query_demands(&bond->expr, BS_TEST_BOND_UP, &value))
        up = 1;
    else if (bs_query_demands(&bond->expr, BS_TEST_BOND_DOWN, &value))
        up = -1;
    else
        return 0;
    *or_none = *or_none || value == 1;
    return bond->a == from ? up : -up;
}

/* All pairs of directed bonds at the two ends of one bond. */
static void add_geometries(bs_pattern *pattern, const bs_query_bond *middle, int *count, bool write)
{
    const bs_query *query = pattern->query;

    for (int i = 0; i < query->bond_count; i++) {
        const bs_query_bond *at_a = &query->bonds[i];

        if (at_a == middle || (at_a->a != middle->a && at_a->b != middle->a))
            continue;
        for (int k = 0; k < query->bond_count; k++) {
            const bs_query_bond *at_b = &query->bonds[k];
            bool or_none = false;
            int up_a, up_b;

            if (at_b == middle || (at_b->a != middle->b && at_b->b != middle->b))
                continue;
            up_a = direction(at_a, middle->a, &or_none);
            up_b = direction(at_b, middle->b, &or_none);
            if (up_a == 0 || up_b == 0)
                continue;
            if (write)
                pattern->geometries[*count] = (bs_geometry_check){
                    .end_a = middle->a,
                    .end_b = middle->b,
                    .beside_a = at_a->a == middle->a ? at_a->b : at_a->a,
                    .beside_b = at_b->a == middle->b ? at_b->b : at_b->a,
                    .cis = up_a == up_b,
                    .or_none = or_none,
                };
            ++*count;
        }
    }
}

static bs_status plan_geometries(bs_ctx *cx, bs_arena *home, bs_pattern *pattern)
{
    const bs_query *query = pattern->query;
    bs_status st = BS_OK;

    for (int pass = 0; st == BS_OK && pass < 2; pass++) {
        pattern->geometry_count = 0;
        for (int i = 0; i < query->bond_count; i++) {
            const bs_query_bond *middle = &query->bonds[i];

            if (bs_query_demands(&middle->expr, BS_TEST_BOND_DOUBLE, NULL))
                add_geometries(pattern, middle, &pattern->geometry_count, pass == 1);
        }
        if (pass == 0)
            st = bs_new(cx, home, pattern->geometry_count, &pattern->geometries);
    }
    return st;
}

/* ---- The whole ------------------------------------------------------------------------- */

static int count_subs(const bs_query *query)
{
    int count = query->sub_count;

    for (int i = 0; i < query->sub_count; i++)
        count += count_subs(query->subs[i]);
    return count;
}

/* Compiles one query; its recursive parts get the next numbers of the whole. */
static bs_status compile_part(bs_ctx *cx, bs_arena *home, const bs_query *query, bool recursive,
                              bs_pattern **subs, int *next_sub, bs_pattern **out)
{
    bs_mark mark = bs_arena_mark(&cx->scratch);
    bs_pattern *pattern = NULL;
    int *sub_number;
    bs_status st = bs_new(cx, &cx->scratch, query->sub_count, &sub_number);

    if (st == BS_OK)
        st = bs_new(cx, home, 1, &pattern);
    for (int i = 0; st == BS_OK && i < query->sub_count; i++) {
        sub_number[i] = (*next_sub)++;
        st = compile_part(cx, home, query->subs[i], true, subs, next_sub, &subs[sub_number[i]]);
    }
    if (st == BS_OK) {
        *pattern = (bs_pattern){.query = query, .atom_count = query->atom_count, .subs = subs};
        st = bs_new(cx, home, query->atom_count, &pattern->exprs);
    }
    for (int i = 0; st == BS_OK && i < query->atom_count; i++) {
        bs_query_expr plain;

        pattern->has_groups = pattern->has_groups || query->atoms[i].component != 0;
        st = bs_query_relax_expr(cx, &cx->scratch, &query->atoms[i].expr, BS_RELAX_CHIRAL, &plain);
        if (st == BS_OK)
            st = compile_expr(cx, home, &plain, sub_number, &pattern->exprs[i]);
    }
    if (st == BS_OK)
        st = bs_new(cx, home, query->bond_count, &pattern->bond_masks);
    for (int i = 0; st == BS_OK && i < query->bond_count; i++)
        st = bs_query_bond_mask(cx, &query->bonds[i].expr, &pattern->bond_masks[i]);
    if (st == BS_OK)
        st = plan_visits(cx, home, pattern, recursive);
    if (st == BS_OK)
        st = plan_hands(cx, home, pattern, sub_number);
    if (st == BS_OK)
        st = plan_geometries(cx, home, pattern);
    bs_arena_rewind(&cx->scratch, mark);
    *out = pattern;
    return st;
}

bs_status bs_query_compile(bs_ctx *cx, bs_arena *home, const bs_query *query, bs_pattern **out)
{
    bs_mark kept = bs_arena_mark(home);
    int sub_count = count_subs(query), next_sub = 0;
    bs_pattern **subs, *pattern = NULL;
    bs_query *copy;
    char *text;
    bs_status st;

    if (query->atom_count == 0)
        return bs_fail_at(cx, BS_ESYNTAX, 0, "expected an atom, found the end of the text");
    if (sub_count > INT16_MAX)
        return bs_fail(cx, BS_ELIMIT, "too many recursive parts in a pattern");
    if ((st = bs_query_copy(cx, home, query, &copy)) != BS_OK ||
        (st = bs_new(cx, home, sub_count, &subs)) != BS_OK ||
        (st = compile_part(cx, home, copy, false, subs, &next_sub, &pattern)) != BS_OK)
        goto done;
    for (int i = 0; i < sub_count; i++)
        subs[i]->sub_count = sub_count;
    pattern->sub_count = sub_count;
    pattern->text = copy->text;
    if (!pattern->text) {
        st = bs_query_write(cx, home, copy, &text);
        pattern->text = text;
    }
done:
    if (st != BS_OK)
        bs_arena_rewind(home, kept);
    else
        *out = pattern;
    return st;
}

bs_status bs_pattern_read(bs_ctx *cx, bs_arena *home, const char *text, size_t length,
                          bs_pattern **out)
{
    bs_mark kept = bs_arena_mark(home);
    bs_query *query;
    bs_status st = bs_query_read(cx, home, text, length, 0, &query);

    if (st == BS_OK)
        st = bs_query_compile(cx, home, query, out);
    if (st != BS_OK)
        bs_arena_rewind(home, kept);
    return st;
}

const char *bs_pattern_text(const bs_pattern *pattern)
{
    return pattern->text;
}

int bs_pattern_atom_count(const bs_pattern *pattern)
{
    return pattern->atom_count;
}

int bs_pattern_map(const bs_pattern *pattern, int atom)
{
    return pattern->query->atoms[atom].map;
}

const bs_query *bs_pattern__query(const bs_pattern *pattern)
{
    return pattern->query;
}

bool bs_pattern__bond_passes(const bs_pattern *pattern, int bond, const bs_mol *mol, uint32_t where)
{
    return pattern->bond_masks[bond] >> bs_bond__state(&bs_mol__bonds(mol)[where]) & 1;
}
