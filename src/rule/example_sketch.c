/* Writing patterns as SMARTS: each piece as a tree with ring closures. */
#include <stdio.h>
#include <string.h>

#include "rule/example.h"

typedef struct writer {
    const bs_sketch *sketch;
    bs_text *text;
    int *parent;   /* bond to the atom before; -1 for a first atom, -2 not yet met */
    int *place;    /* of each atom: when it was met */
    int *digit;    /* of each bond: the ring closure, 0 for none */
    int *slant;    /* of each bond, from a to b: 1 up, -1 down, 0 not said */
    bool *in_tree; /* of each bond */
    int *stack;
    int closures;
} writer;

static int other_end(const bs_sketch_bond *bond, int atom)
{
    return bond->a == atom ? bond->b : bond->a;
}

/* ---- The tree ----------------------------------------------------------------------------------
 */

/* Walks depth first, so that bonds beside the tree lead back along it. */
static void grow_tree(writer *w, int root, int *met)
{
    const bs_sketch *s = w->sketch;
    int depth = 0, atom;

    w->stack[0] = root;
    w->parent[root] = -1;
    w->place[root] = (*met)++;
    while (depth >= 0) {
        bool deeper = false;

        atom = w->stack[depth];
        for (int i = 0; i < s->bond_count && !deeper; i++) {
            int next = other_end(&s->bonds[i], atom);

            if ((s->bonds[i].a != atom && s->bonds[i].b != atom) || w->in_tree[i] || w->digit[i])
                continue;
            if (w->parent[next] == -2) {
                w->parent[next] = i;
                w->place[next] = (*met)++;
                w->in_tree[i] = deeper = true;
                w->stack[++depth] = next;
            } else {
                w->digit[i] = ++w->closures;
            }
        }
        if (!deeper)
            depth--;
    }
}

/* ---- Hands -------------------------------------------------------------------------------------
 */

/* Whether two lists of four hold the same in an order that is an odd permutation. */
static bool is_odd(const int *a, const int *b)
{
    int at[4], odd = 0;

    for (int i = 0; i < 4; i++) {
        at[i] = 0;
        while (at[i] < 3 && b[at[i]] != a[i])
            at[i]++;
    }
    for (int i = 0; i < 4; i++) {
        for (int k = i + 1; k < 4; k++)
            odd += at[i] > at[k];
    }
    return odd % 2 != 0;
}

/* The atoms around `atom` in the order of the text; false if more than one is not written. */
static bool list_around(const writer *w, int atom, int *out)
{
    const bs_sketch *s = w->sketch;
    const bs_sketch_atom *a = &s->atoms[atom];
    int count = 0, rest = 0;

    for (int i = 0; i < 4; i++)
        rest += a->around[i] < 0;
    if (rest > 1)
        return false;
    if (w->parent[atom] >= 0)
        out[count++] = other_end(&s->bonds[w->parent[atom]], atom);
    for (int i = 0; i < 4; i++) {
        if (a->around[i] < 0)
            out[count++] = a->around[i];
    }
    for (int pass = 0; pass < 2; pass++) {
        for (int i = 0; i < s->bond_count && count < 4; i++) {
            if ((s->bonds[i].a != atom && s->bonds[i].b != atom) || w->parent[atom] == i ||
                (pass == 0) == (w->digit[i] == 0))
                continue;
            out[count++] = other_end(&s->bonds[i], atom);
        }
    }
    return count == 4;
}

static const char *mark_of(const writer *w, int atom)
{
    const bs_sketch_atom *a = &w->sketch->atoms[atom];
    int order[4];
    bool clockwise = a->hand == BS_HAND_CLOCKWISE;

    if (a->hand == BS_HAND_NONE || !list_around(w, atom, order))
        return "";
    if (is_odd(a->around, order))
        clockwise = !clockwise;
    return clockwise ? "@@" : "@";
}

/* ---- Double bonds ------------------------------------------------------------------------------
 */

/* Slants of single bonds, so that each double bond has its geometry; one that cannot be is left
 * out. */
static void find_slants(writer *w)
{
    const bs_sketch *s = w->sketch;

    for (int i = 0; i < s->slope_count; i++) {
        const bs_sketch_slope *slope = &s->slopes[i];
        int x = s->bonds[slope->x].a == slope->a ? 1 : -1;
        int y = s->bonds[slope->y].a == slope->b ? 1 : -1;
        int turn = x * y * (slope->trans ? -1 : 1);

        if (w->slant[slope->x] == 0 && w->slant[slope->y] == 0)
            w->slant[slope->x] = x;
        if (w->slant[slope->y] == 0)
            w->slant[slope->y] = w->slant[slope->x] * turn;
        else if (w->slant[slope->x] == 0)
            w->slant[slope->x] = w->slant[slope->y] * turn;
    }
}

/* The text of a bond as it is written from `atom` on. */
static const char *text_of(const writer *w, int bond, int atom)
{
    int slant = w->sketch->bonds[bond].a == atom ? w->slant[bond] : -w->slant[bond];

    if (slant == 0)
        return w->sketch->bonds[bond].text;
    return slant > 0 ? "/" : "\\";
}

/* ---- Text --------------------------------------------------------------------------------------
 */

static bs_status write_atom(writer *w, int atom)
{
    const bs_sketch *s = w->sketch;
    bs_status st = bs_text_printf(w->text, "%s%s%s", s->atoms[atom].before, mark_of(w, atom),
                                  s->atoms[atom].behind);

    for (int i = 0; i < s->bond_count && st == BS_OK; i++) {
        int next = other_end(&s->bonds[i], atom);

        if ((s->bonds[i].a != atom && s->bonds[i].b != atom) || !w->digit[i])
            continue;
        /* The order stands at the end that is written first. */
        st = bs_text_puts(w->text, w->place[atom] < w->place[next] ? text_of(w, i, atom) : "");
        if (st == BS_OK && w->digit[i] > 9)
            st = bs_text_putc(w->text, '%');
        if (st == BS_OK)
            st = bs_text_printf(w->text, "%d", w->digit[i]);
    }
    return st;
}

/* The bond to the next child of an atom behind bond `after`, or -1. */
static int next_child(const writer *w, int atom, int after)
{
    for (int i = after + 1; i < w->sketch->bond_count; i++) {
        const bs_sketch_bond *bond = &w->sketch->bonds[i];

        if ((bond->a == atom || bond->b == atom) && w->in_tree[i] && w->parent[atom] != i)
            return i;
    }
    return -1;
}

static bs_status write_tree(writer *w, int root, int *child, bool *open)
{
    const bs_sketch *s = w->sketch;
    int depth = 0;
    bs_status st = write_atom(w, root);

    w->stack[0] = root;
    child[0] = next_child(w, root, -1);
    open[0] = false;
    while (depth >= 0 && st == BS_OK) {
        int bond = child[depth], atom = w->stack[depth], next;

        if (bond < 0) {
            if (open[depth])
                st = bs_text_putc(w->text, ')');
            depth--;
            continue;
        }
        next = other_end(&s->bonds[bond], atom);
        child[depth] = next_child(w, atom, bond);
        depth++;
        open[depth] = child[depth - 1] >= 0;
        if (open[depth])
            st = bs_text_putc(w->text, '(');
        if (st == BS_OK)
            st = bs_text_puts(w->text, text_of(w, bond, atom));
        if (st == BS_OK)
            st = write_atom(w, next);
        w->stack[depth] = next;
        child[depth] = next_child(w, next, -1);
    }
    return st;
}

/* Writes the trees of one part, in parentheses if there are several. */
static bs_status write_part(writer *w, int part, int *child, bool *open)
{
    const bs_sketch *s = w->sketch;
    int roots = 0, done = 0;
    bs_status st = BS_OK;

    for (int i = 0; i < s->atom_count; i++)
        roots += s->atoms[i].part == part && w->parent[i] == -1;
    if (roots > 0 && w->text->length > 0)
        st = bs_text_putc(w->text, '.');
    for (int i = 0; i < s->atom_count && st == BS_OK; i++) {
        if (s->atoms[i].part != part || w->parent[i] != -1)
            continue;
        if (roots > 1)
            st = bs_text_putc(w->text, done == 0 ? '(' : '.');
        if (st == BS_OK)
            st = write_tree(w, i, child, open);
        done++;
    }
    return st == BS_OK && roots > 1 ? bs_text_putc(w->text, ')') : st;
}

static bs_status write_all(bs_ctx *cx, writer *w)
{
    int atoms = w->sketch->atom_count, met = 0, parts = 0;
    int *child;
    bool *open;
    bs_status st;

    if ((st = bs_new(cx, &cx->scratch, atoms + 1, &child)) != BS_OK ||
        (st = bs_new(cx, &cx->scratch, atoms + 1, &open)) != BS_OK)
        return st;
    for (int i = 0; i < atoms; i++)
        w->parent[i] = -2;
    for (int i = 0; i < atoms; i++) {
        if (w->parent[i] == -2)
            grow_tree(w, i, &met);
        if (w->sketch->atoms[i].part >= parts)
            parts = w->sketch->atoms[i].part + 1;
    }
    find_slants(w);
    for (int i = 0; i < parts && st == BS_OK; i++)
        st = write_part(w, i, child, open);
    return st;
}

bs_status bs_sketch__write(bs_ctx *cx, bs_arena *home, const bs_sketch *sketch, char **out)
{
    bs_mark temp = bs_arena_mark(&cx->scratch);
    bs_text text;
    writer w = {.sketch = sketch, .text = &text};
    int atoms = sketch->atom_count + 1, bonds = sketch->bond_count + 1;
    bs_status st;

    bs_text_init(&text, cx);
    if ((st = bs_new(cx, &cx->scratch, atoms, &w.parent)) == BS_OK &&
        (st = bs_new(cx, &cx->scratch, atoms, &w.place)) == BS_OK &&
        (st = bs_new(cx, &cx->scratch, bonds, &w.digit)) == BS_OK &&
        (st = bs_new(cx, &cx->scratch, bonds, &w.slant)) == BS_OK &&
        (st = bs_new(cx, &cx->scratch, bonds, &w.in_tree)) == BS_OK &&
        (st = bs_new(cx, &cx->scratch, atoms, &w.stack)) == BS_OK &&
        (st = write_all(cx, &w)) == BS_OK)
        st = bs_copy_text(cx, home, text.data ? text.data : "", text.length, out);
    bs_text_free(&text);
    bs_arena_rewind(&cx->scratch, temp);
    return st;
}
