/* Writes the expressions of SMARTS. */
#include "match/write.h"

#include <ctype.h>
#include <string.h>

/*
 * How loosely an expression may bind where it stands. SMARTS has no brackets for logic: what
 * binds more loosely than its place allows is written as a recursion on one atom.
 */
enum { LOW, MIDDLE, HIGH };

/* A piece of work on the writer's pile: a tree of the expression, or a fixed text. */
typedef struct chore {
    int tree; /* index of its root, -1 for a text */
    int place;
    const char *word;
} chore;

typedef struct printer {
    bs_writing *w;
    const bs_query_expr *expr;
    int *size;
    bool *holds_or; /* an AND with an OR among its operands */
    chore *pile;
    int height;
    bool mirror;
    bool is_bond;
    bool unwritable; /* a bond that nests too deep */
} printer;

static bs_status put_symbol(bs_text *text, int element, bool aromatic)
{
    const char *symbol = bs_element_symbol(element);

    if (element == 0 || element == 1 || element == 113 || !symbol)
        return bs_text_printf(text, "#%d", element);
    if (!aromatic)
        return bs_text_puts(text, symbol);
    if (!strstr(" B C N O P S Si As Se Te ", symbol))
        return bs_text_printf(text, "$([#%d&a])", element);
    return bs_text_printf(text, "%c%s", tolower((unsigned char)symbol[0]), symbol + 1);
}

static bs_status put_charge(bs_text *text, int value)
{
    if (value == 1 || value == -1)
        return bs_text_putc(text, value < 0 ? '-' : '+');
    return bs_text_printf(text, "%c%d", value < 0 ? '-' : '+', value < 0 ? -value : value);
}

static bs_status put_chiral(bs_text *text, int value, bool mirror)
{
    int hand = (value - 1) % 2;

    if (mirror)
        hand = !hand;
    return bs_text_printf(text, "%s%s", hand ? "@@" : "@", value > 2 ? "?" : "");
}

static bs_status put_sub(bs_writing *w, int index)
{
    bs_writing inner = *w;
    bs_status st;

    if (w->depth >= BS_QUERY_MAX_DEPTH)
        return bs_fail(w->cx, BS_ELIMIT, "recursion nested deeper than %d", BS_QUERY_MAX_DEPTH);
    inner.query = w->query->subs[index];
    inner.depth++;
    if ((st = bs_text_puts(w->text, "$(")) != BS_OK)
        return st;
    if ((st = bs_write__query(&inner)) != BS_OK)
        return st;
    return bs_text_putc(w->text, ')');
}

/* A letter and its number; no number for "some". */
static bs_status put_counted(bs_text *text, char letter, int value)
{
    if (value < 0)
        return bs_text_putc(text, letter);
    return bs_text_printf(text, "%c%d", letter, value);
}

static bs_status put_atom_test(bs_writing *w, const bs_test *test, bool mirror)
{
    static const char letters[] = {
        [BS_TEST_DEGREE] = 'D',      [BS_TEST_HYDROGENS] = 'H',  [BS_TEST_IMPLICIT_H] = 'h',
        [BS_TEST_RING_COUNT] = 'R',  [BS_TEST_RING_SIZE] = 'r',  [BS_TEST_VALENCE] = 'v',
        [BS_TEST_CONNECTIONS] = 'X', [BS_TEST_RING_BONDS] = 'x', [BS_TEST_HYBRID] = '^',
    };
    bs_text *text = w->text;

    switch (test->kind) {
    case BS_TEST_ELEMENT:
        return bs_text_printf(text, "#%d", test->value);
    case BS_TEST_ALIPHATIC_ELEM:
    case BS_TEST_AROMATIC_ELEM:
        return put_symbol(text, test->value, test->kind == BS_TEST_AROMATIC_ELEM);
    case BS_TEST_ALIPHATIC:
        return bs_text_putc(text, 'A');
    case BS_TEST_AROMATIC:
        return bs_text_putc(text, 'a');
    case BS_TEST_ISOTOPE:
        return bs_text_printf(text, "%d", test->value);
    case BS_TEST_CHARGE:
        return put_charge(text, test->value);
    case BS_TEST_CHIRAL:
        return put_chiral(text, test->value, mirror);
    case BS_TEST_RECURSE:
        return put_sub(w, test->value);
    case BS_TEST_ANY:
        return bs_text_putc(text, '*');
    default:
        /* NOLINTNEXTLINE(clang-analyzer-core.CallAndMessage): all other kinds have a letter */
        return put_counted(text, letters[test->kind], test->value);
    }
}

static bs_status put_bond_test(bs_text *text, const bs_test *test, bool back)
{
    const char *words[] = {"~", "-", "=", "#", "$", ":", "@", "/", "\\", "-,:"};
    int kind = test->kind;

    if (back && kind == BS_TEST_BOND_UP)
        kind = BS_TEST_BOND_DOWN;
    else if (back && kind == BS_TEST_BOND_DOWN)
        kind = BS_TEST_BOND_UP;
    return bs_text_printf(text, "%s%s", words[kind - BS_TEST_BOND_ANY], test->value ? "?" : "");
}

/* ---- Logic ----------------------------------------------------------------------------- */

static int left_of(const printer *p, int tree)
{
    return tree - 1 - p->size[tree - 1];
}

static void push(printer *p, int tree, int place, const char *word)
{
    p->pile[p->height++] = (chore){tree, place, word};
}

static void find_ors(printer *p)
{
    for (int i = 0; i < p->expr->count; i++) {
        int operands[2];

        if (p->expr->tests[i].kind != BS_TEST_AND)
            continue;
        operands[0] = i - 1;
        operands[1] = left_of(p, i);
        for (int k = 0; k < 2; k++) {
            int kind = p->expr->tests[operands[k]].kind;
            p->holds_or[i] |=
                kind == BS_TEST_OR || (kind == BS_TEST_AND && p->holds_or[operands[k]]);
        }
    }
}

/* A default bond is written as nothing where it is alone, and as a choice elsewhere. */
static int loosest(const printer *p, int tree)
{
    switch (p->expr->tests[tree].kind) {
    case BS_TEST_AND:
        return p->holds_or[tree] ? LOW : HIGH;
    case BS_TEST_OR:
    case BS_TEST_BOND_DEFAULT:
        return MIDDLE;
    default:
        return HIGH + 1;
    }
}

static bs_status print_tree(printer *p, int tree, int place)
{
    const bs_test *test = &p->expr->tests[tree];
    int needs = loosest(p, tree);

    if (needs < place) {
        p->unwritable |= p->is_bond;
        push(p, -1, 0, "])");
        push(p, tree, LOW, NULL);
        return bs_text_puts(p->w->text, "$([");
    }
    switch (test->kind) {
    case BS_TEST_NOT:
        push(p, tree - 1, HIGH + 1, NULL);
        return bs_text_putc(p->w->text, '!');
    case BS_TEST_AND:
    case BS_TEST_OR:
        push(p, tree - 1, needs, NULL);
        push(p, -1, 0, needs == LOW ? ";" : needs == MIDDLE ? "," : "&");
        push(p, left_of(p, tree), needs, NULL);
        return BS_OK;
    default:
        return p->is_bond ? put_bond_test(p->w->text, test, p->mirror)
                          : put_atom_test(p->w, test, p->mirror);
    }
}

/* Prints the whole expression. `unwritable` is set if it is a bond that SMARTS cannot nest. */
static bs_status print_expr(printer *p)
{
    bs_arena *scratch = &p->w->cx->scratch;
    bs_mark temp = bs_arena_mark(scratch);
    int count = p->expr->count;
    bs_status st;

    p->height = 0;
    if ((st = bs_query_sizes(p->w->cx, scratch, p->expr, &p->size)) != BS_OK ||
        (st = bs_new(p->w->cx, scratch, count, &p->holds_or)) != BS_OK ||
        (st = bs_new(p->w->cx, scratch, 4 * count + 4, &p->pile)) != BS_OK)
        goto done;
    find_ors(p);
    push(p, count - 1, LOW, NULL);
    while (p->height > 0 && st == BS_OK) {
        chore next = p->pile[--p->height];

        st = next.tree < 0 ? bs_text_puts(p->w->text, next.word)
                           : print_tree(p, next.tree, next.place);
    }
done:
    bs_arena_rewind(scratch, temp);
    return st;
}

static bool is_bare(const bs_query_atom *atom)
{
    const bs_test *test = atom->expr.tests;
    int element = test->value;

    if (atom->expr.count != 1 || atom->map != 0)
        return false;
    switch (test->kind) {
    case BS_TEST_ANY:
    case BS_TEST_ALIPHATIC:
    case BS_TEST_AROMATIC:
        return true;
    case BS_TEST_ALIPHATIC_ELEM:
        return (element >= 5 && element <= 9) || (element >= 15 && element <= 17) ||
               element == 35 || element == 53;
    case BS_TEST_AROMATIC_ELEM:
        return (element >= 5 && element <= 8) || element == 15 || element == 16;
    default:
        return false;
    }
}

bs_status bs_write__atom(bs_writing *w, const bs_query_atom *atom, bool mirror)
{
    printer p = {.w = w, .expr = &atom->expr, .mirror = mirror};
    bs_status st;

    if (is_bare(atom))
        return print_expr(&p);
    if ((st = bs_text_putc(w->text, '[')) != BS_OK || (st = print_expr(&p)) != BS_OK)
        return st;
    if (atom->map != 0 && (st = bs_text_printf(w->text, ":%d", atom->map)) != BS_OK)
        return st;
    return bs_text_putc(w->text, ']');
}

/*
 * A bond expression of any depth as a choice among the sorts of bond that it accepts: order 0 to
 * 4 or aromatic, in a ring or not. Directions count as single bonds here.
 */
static bs_status print_choice(bs_writing *w, const bs_query_expr *expr)
{
    static const char *const orders[] = {"!-&!=&!#&!$&!:", "-", "=", "#", "$", ":"};
    uint32_t mask;
    bool first = true;
    bs_status st = bs_query_bond_mask(w->cx, expr, &mask);

    for (int sort = 0; sort < 12 && st == BS_OK; sort++) {
        int order = sort % 6, ring = sort / 6;
        int place = order == 5 ? 1 | 1 << 3 | ring << 4 : order | ring << 4;

        if (!(mask >> place & 1))
            continue;
        st = bs_text_printf(w->text, "%s%s&%s@", first ? "" : ",", orders[order], ring ? "" : "!");
        first = false;
    }
    if (st == BS_OK && first)
        st = bs_text_puts(w->text, "!~");
    return st;
}

bs_status bs_write__bond(bs_writing *w, const bs_query_bond *bond, bool back)
{
    printer p = {.w = w, .expr = &bond->expr, .mirror = back, .is_bond = true};
    size_t before = w->text->length;
    bs_status st;

    if (bond->expr.count == 1 && bond->expr.tests[0].kind == BS_TEST_BOND_DEFAULT)
        return BS_OK;
    st = print_expr(&p);
    if (st != BS_OK || !p.unwritable)
        return st;
    w->text->length = before;
    w->text->data[before] = '\0';
    return print_choice(w, &bond->expr);
}
