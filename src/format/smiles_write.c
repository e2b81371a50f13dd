/* Writing a planned SMILES. */
#include "format/smiles_write.h"

#include "chem/stereo.h"
#include "chem/valence.h"

#include <stdio.h>
#include <string.h>

enum { MAX_RING_NUMBER = 99 };

typedef struct writer {
    const smiles_plan *plan;
    bs_text text;
    uint32_t *at;    /* by place: byte at which the atom starts */
    uint8_t *number; /* by bond: number of the ring closure */
    bool in_use[MAX_RING_NUMBER + 1];
    uint32_t *stack;
} writer;

/* Elements as bits: those above 63 are in none of the sets. */
static bool is_in(uint64_t set, int element)
{
    return element < 64 && (set >> element & 1);
}

#define BIT(n) ((uint64_t)1 << (n))

/* Adds a byte; there is room nearly always. */
static inline bs_status put(writer *w, char c)
{
    bs_text *text = &w->text;

    if (text->length + 1 >= text->room)
        return bs_text_putc(text, c);
    text->data[text->length++] = c;
    text->data[text->length] = '\0';
    return BS_OK;
}

/* ---- Atoms ---------------------------------------------------------------------------------- */

/* The symbol of an atom as it is written, in lower case for aromatic ones that have such a form. */
static bool is_lower(const bs_atom *a)
{
    const uint64_t elements = BIT(5) | BIT(6) | BIT(7) | BIT(8) | BIT(14) | BIT(15) | BIT(16) |
                              BIT(33) | BIT(34) | BIT(52);

    return (a->flags & BS_ATOM_AROMATIC) && is_in(elements, a->element);
}

/* Bonds of an atom as a reader of the string would count them before placing double bonds. */
static int written_sum(const bs_mol *mol, uint32_t atom, bool *multiple)
{
    const bs_bond *bonds = bs_mol__bonds(mol);
    const bs_link *links = bs_mol__links(mol, atom);
    int sum = 0;

    *multiple = false;
    for (int k = 0; k < mol->atoms[atom].degree; k++) {
        const bs_bond *b = &bonds[links[k].bond];
        int order = b->flags & BS_BOND_AROMATIC ? 1 : (int)b->order;

        *multiple |= order > 1;
        sum += order;
    }
    return sum;
}

/* Hydrogens that a reader would give the atom without brackets. */
static int bare_hydrogens(const bs_mol *mol, uint32_t atom)
{
    const bs_atom *a = &mol->atoms[atom];
    const uint8_t *v = bs_valence__normal(a->element, 0);
    bool multiple;
    int sum;

    if (!is_lower(a))
        return bs_valence__implied(a->element, 0, a->valence - a->hydrogens);
    sum = written_sum(mol, atom, &multiple);
    if (multiple && a->element == 6)
        return bs_valence__implied(a->element, 0, sum);
    while (*v != 0 && *v < sum)
        v++;
    return *v == 0 || *v == sum ? 0 : *v - sum - 1;
}

static bool needs_bracket(const smiles_plan *plan, uint32_t atom, bool has_mark)
{
    const uint64_t lower = BIT(5) | BIT(6) | BIT(7) | BIT(8) | BIT(15) | BIT(16);
    const uint64_t upper = lower | BIT(0) | BIT(9) | BIT(17) | BIT(35) | BIT(53);
    const bs_atom *a = &plan->mol->atoms[atom];
    bool known = is_in(is_lower(a) ? lower : upper, a->element);

    return !known || has_mark || a->charge != 0 || a->isotope != 0 ||
           (a->label != 0 && (plan->flags & BS_SMILES_LABELS)) ||
           a->hydrogens != bare_hydrogens(plan->mol, atom);
}

/* ---- Marks of centres ------------------------------------------------------------------------ */

/*
 * The neighbours of an atom as the string names them, with an implied hydrogen or lone pair where
 * a reader sees it; see smiles_stereo.c. `skip` is left out.
 */
static int written_order(const smiles_plan *plan, uint32_t atom, uint32_t skip, int most,
                         uint32_t *out)
{
    const bs_atom *a = &plan->mol->atoms[atom];
    const bs_link *links = smiles_plan_links(plan, atom);
    bool follows = false;
    int count = 0;
    int where;

    for (int k = 0; k < a->degree; k++) {
        if (links[k].atom == skip)
            continue;
        if (count == most)
            return 0;
        follows |= plan->entry[atom] == links[k].bond;
        out[count++] = links[k].atom;
    }
    if (count == most)
        return most;
    if (count < most - 1)
        return 0;
    where = follows || a->hydrogens == 0 ? 1 : 0;
    for (int i = count; i > where; i--)
        out[i] = out[i - 1];
    out[where] = BS_DRAFT_HYDROGEN;
    return most;
}

/* The far end of cumulated double bonds from `from` through `at`; *before is the atom before it. */
static uint32_t chain_end(const bs_mol *mol, uint32_t from, uint32_t at, uint32_t *before)
{
    const bs_bond *bonds = bs_mol__bonds(mol);

    for (uint32_t steps = 0; steps < mol->atom_count; steps++) {
        const bs_link *links = bs_mol__links(mol, at);
        const bs_link *onward;

        *before = from;
        if (mol->atoms[at].degree != 2)
            break;
        onward = links[0].atom == from ? &links[1] : &links[0];
        if (bonds[onward->bond].order != 2)
            break;
        from = at;
        at = onward->atom;
    }
    return at;
}

/* The perm of an allene in written order, or 0. */
static int allene_perm(const smiles_plan *plan, uint32_t atom, const uint32_t around[6])
{
    const bs_link *links = smiles_plan_links(plan, atom);
    int perm = plan->mol->atoms[atom].perm;

    for (int k = 0; k < 2; k++) {
        uint32_t before = atom;
        uint32_t end = chain_end(plan->mol, atom, links[k].atom, &before);
        uint32_t pair[2];
        const uint32_t *known;

        if (written_order(plan, end, before, 2, pair) != 2)
            return 0;
        /* Exchanging the two ends is an even change, so only the order within each counts. */
        known = bs_mol__links(plan->mol, atom)[0].atom == links[k].atom ? around : around + 2;
        if (pair[0] == known[1] && pair[1] == known[0])
            perm = 3 - perm;
        else if (pair[0] != known[0] || pair[1] != known[1])
            return 0;
    }
    return perm;
}

/* Writes the mark of an atom into `mark`; empty if it has none. */
static void write_mark(const smiles_plan *plan, uint32_t atom, char mark[8])
{
    static const char *const names[] = {"", "TH", "AL", "SP", "TB", "OH"};
    const bs_atom *a = &plan->mol->atoms[atom];
    uint32_t around[6];
    uint32_t written[6];
    int count;
    int perm;

    mark[0] = '\0';
    if (a->stereo == BS_STEREO_NONE || (plan->flags & BS_SMILES_NO_STEREO))
        return;
    count = bs_stereo__around(plan->mol, atom, a->stereo, around);
    if (count == 0)
        return;
    if (a->stereo == BS_STEREO_ALLENE)
        perm = allene_perm(plan, atom, around);
    else if (written_order(plan, atom, UINT32_MAX, count, written) != count)
        return;
    else
        perm = bs_stereo__permute(a->stereo, a->perm, count, around, written);
    if (perm > 0 && a->stereo <= BS_STEREO_ALLENE)
        strcpy(mark, perm == 1 ? "@" : "@@");
    else if (perm > 0)
        snprintf(mark, 8, "@%s%u", names[a->stereo], (unsigned)perm & 0xff);
}

static bs_status write_symbol(writer *w, const bs_atom *a)
{
    const char *symbol = bs_element_symbol(a->element);
    bs_status st = put(w, is_lower(a) ? (char)(*symbol - 'A' + 'a') : *symbol);

    while (st == BS_OK && *++symbol)
        st = put(w, *symbol);
    return st;
}

static bs_status write_charge(writer *w, int charge)
{
    int size = charge < 0 ? -charge : charge;

    if (charge == 0)
        return BS_OK;
    if (size == 1)
        return put(w, charge < 0 ? '-' : '+');
    return bs_text_printf(&w->text, "%c%d", charge < 0 ? '-' : '+', size);
}

static bs_status write_bracket(writer *w, uint32_t atom, const char *mark)
{
    const bs_atom *a = &w->plan->mol->atoms[atom];
    int hydrogens = a->hydrogens - (w->plan->hydrogen[atom] != 0);
    bs_status st;

    if ((st = put(w, '[')) != BS_OK ||
        (a->isotope && (st = bs_text_printf(&w->text, "%u", a->isotope)) != BS_OK) ||
        (st = write_symbol(w, a)) != BS_OK || (st = bs_text_puts(&w->text, mark)) != BS_OK)
        return st;
    if (hydrogens > 0 && (st = put(w, 'H')) != BS_OK)
        return st;
    if (hydrogens > 1 && (st = bs_text_printf(&w->text, "%d", hydrogens)) != BS_OK)
        return st;
    if ((st = write_charge(w, a->charge)) != BS_OK)
        return st;
    if (a->label && (w->plan->flags & BS_SMILES_LABELS) &&
        (st = bs_text_printf(&w->text, ":%u", a->label)) != BS_OK)
        return st;
    return put(w, ']');
}

static bs_status write_atom(writer *w, uint32_t atom)
{
    char mark[8];

    w->at[w->plan->place[atom]] = (uint32_t)w->text.length;
    write_mark(w->plan, atom, mark);
    if (needs_bracket(w->plan, atom, mark[0] != '\0'))
        return write_bracket(w, atom, mark);
    return write_symbol(w, &w->plan->mol->atoms[atom]);
}

/* ---- Bonds ------------------------------------------------------------------------------------
 */

/* The symbol in front of an atom or ring number, 0 for none. */
static char bond_symbol(const smiles_plan *plan, uint32_t bond)
{
    const bs_bond *b = bs_mol__bonds(plan->mol) + bond;
    const bs_atom *x = &plan->mol->atoms[b->a];
    const bs_atom *y = &plan->mol->atoms[b->b];
    bool lower_x = is_lower(x);
    bool lower_y = is_lower(y);
    bool unknown = (lower_x && y->element == 0) || (lower_y && x->element == 0);

    if (plan->slants[bond])
        return plan->slants[bond];
    if (b->flags & BS_BOND_AROMATIC)
        return (lower_x && lower_y) || unknown ? '\0' : ':';
    switch (b->order) {
    case 2:
        return '=';
    case 3:
        return '#';
    case 4:
        return '$';
    default:
        /* Without a symbol a reader would take it for aromatic. */
        return (lower_x && lower_y) || (unknown && (b->flags & BS_BOND_RING)) ? '-' : '\0';
    }
}

static bs_status write_bond(writer *w, uint32_t bond)
{
    char symbol = bond_symbol(w->plan, bond);

    return symbol ? put(w, symbol) : BS_OK;
}

static bs_status write_number(writer *w, int number)
{
    if (number < 10)
        return put(w, (char)('0' + number));
    return bs_text_printf(&w->text, "%%%d", number);
}

/* Writes the ring numbers of an atom. A number that ends here is not used again on the same atom.
 */
static bs_status write_closures(writer *w, uint32_t atom)
{
    const smiles_plan *plan = w->plan;
    const bs_link *links = smiles_plan_links(plan, atom) + (plan->entry[atom] != UINT32_MAX);
    int closings = plan->closings[atom];
    int openings = plan->openings[atom];
    bs_status st;

    for (int k = 0; k < closings; k++) {
        if ((st = write_number(w, w->number[links[k].bond])) != BS_OK)
            return st;
    }
    for (int k = closings; k < closings + openings; k++) {
        int number = 1;

        while (number <= MAX_RING_NUMBER && w->in_use[number])
            number++;
        if (number > MAX_RING_NUMBER)
            return bs_fail(plan->cx, BS_ELIMIT,
                           "SMILES cannot hold more than %d open rings at one place",
                           MAX_RING_NUMBER);
        w->in_use[number] = true;
        w->number[links[k].bond] = (uint8_t)number;
        if ((st = write_bond(w, links[k].bond)) != BS_OK || (st = write_number(w, number)) != BS_OK)
            return st;
    }
    for (int k = 0; k < closings; k++)
        w->in_use[w->number[links[k].bond]] = false;
    return BS_OK;
}

/* ---- The string --------------------------------------------------------------------------------
 */

#define CLOSE_BRANCH UINT32_MAX

/* Writes a hydrogen that stands for the geometry of a double bond. */
static bs_status write_hydrogen(writer *w, uint32_t atom, bool in_branch)
{
    char slant = w->plan->hydrogen[atom];

    if (!slant)
        return BS_OK;
    return bs_text_printf(&w->text, in_branch ? "(%c[H])" : "%c[H]", slant);
}

static bs_status write_piece(writer *w, uint32_t root)
{
    const smiles_plan *plan = w->plan;
    const bs_bond *bonds = bs_mol__bonds(plan->mol);
    uint32_t depth = 0;
    bs_status st = BS_OK;

    w->stack[depth++] = root;
    while (depth > 0 && st == BS_OK) {
        uint32_t atom = w->stack[--depth];
        const bs_link *links;
        int degree;
        int first;

        if (atom == CLOSE_BRANCH) {
            st = put(w, ')');
            continue;
        }
        if (plan->entry[atom] != UINT32_MAX) {
            uint32_t before = bs_bond__other(&bonds[plan->entry[atom]], atom);
            const bs_link *last =
                smiles_plan_links(plan, before) + plan->mol->atoms[before].degree - 1;

            if (last->atom != atom && (st = put(w, '(')) != BS_OK)
                break;
            if ((st = write_bond(w, plan->entry[atom])) != BS_OK)
                break;
        }
        if ((st = write_atom(w, atom)) != BS_OK || (st = write_closures(w, atom)) != BS_OK)
            break;
        links = smiles_plan_links(plan, atom);
        degree = plan->mol->atoms[atom].degree;
        first = (plan->entry[atom] != UINT32_MAX) + plan->closings[atom] + plan->openings[atom];
        if ((st = write_hydrogen(w, atom, first < degree)) != BS_OK)
            break;
        for (int k = degree - 1; k >= first; k--) {
            if (k < degree - 1)
                w->stack[depth++] = CLOSE_BRANCH;
            w->stack[depth++] = links[k].atom;
        }
    }
    return st;
}

/* Text of a piece within the whole, for sorting. */
typedef struct piece_text {
    uint32_t piece;
    uint32_t start, length;
} piece_text;

static int compare(const char *text, const piece_text *a, const piece_text *b)
{
    uint32_t least = a->length < b->length ? a->length : b->length;
    int difference = memcmp(text + a->start, text + b->start, least);

    return difference != 0 ? difference : (a->length > b->length) - (a->length < b->length);
}

/* Sorts by merging, so that many equal pieces stay cheap and in order. */
static void sort_pieces(const char *text, piece_text *pieces, piece_text *spare, uint32_t count)
{
    for (uint32_t width = 1; width < count; width *= 2) {
        for (uint32_t low = 0; low < count; low += 2 * width) {
            uint32_t middle = low + width < count ? low + width : count;
            uint32_t high = low + 2 * width < count ? low + 2 * width : count;
            uint32_t a = low;
            uint32_t b = middle;

            for (uint32_t k = low; k < high; k++) {
                bool left = b == high || (a < middle && compare(text, &pieces[a], &pieces[b]) <= 0);

                spare[k] = left ? pieces[a++] : pieces[b++];
            }
        }
        memcpy(pieces, spare, count * sizeof *pieces);
    }
}

static bs_status write_pieces(writer *w, piece_text *pieces)
{
    const smiles_plan *plan = w->plan;
    bs_status st = BS_OK;

    for (uint32_t p = 0; p < plan->piece_count && st == BS_OK; p++) {
        pieces[p].piece = p;
        pieces[p].start = (uint32_t)w->text.length;
        st = write_piece(w, plan->order[plan->starts[p]]);
        pieces[p].length = (uint32_t)w->text.length - pieces[p].start;
        if (st == BS_OK && w->text.length > INT32_MAX)
            st = bs_fail(plan->cx, BS_ELIMIT, "a SMILES of more than %d bytes", INT32_MAX);
    }
    return st;
}

/* Puts the pieces together with dots, and tells where the atoms came to stand. */
static bs_status assemble(writer *w, const piece_text *pieces, bs_arena *home, char **out,
                          uint32_t **order, uint32_t **at)
{
    const smiles_plan *plan = w->plan;
    uint32_t atoms = plan->mol->atom_count;
    uint32_t dots = plan->piece_count > 0 ? plan->piece_count - 1 : 0;
    uint32_t next = 0;
    char *to;
    bs_status st;

    if ((st = bs_new(plan->cx, home, w->text.length + dots + 1, out)) != BS_OK ||
        (order && (st = bs_new(plan->cx, home, atoms, order)) != BS_OK) ||
        (at && (st = bs_new(plan->cx, home, atoms, at)) != BS_OK))
        return st;
    to = *out;
    for (uint32_t i = 0; i < plan->piece_count; i++) {
        const piece_text *p = &pieces[i];

        if (i > 0)
            *to++ = '.';
        for (uint32_t k = plan->starts[p->piece]; k < plan->starts[p->piece + 1]; k++, next++) {
            if (order)
                (*order)[next] = plan->order[k];
            if (at)
                (*at)[next] = w->at[k] - p->start + (uint32_t)(to - *out);
        }
        memcpy(to, w->text.data + p->start, p->length);
        to += p->length;
    }
    return BS_OK;
}

bs_status smiles_write_plan(const smiles_plan *plan, bool sorted, bs_arena *home, char **out,
                            uint32_t **order, uint32_t **at)
{
    writer w = {.plan = plan};
    bs_arena *scratch = &plan->cx->scratch;
    size_t atoms = plan->mol->atom_count;
    piece_text *pieces;
    bs_status st;

    bs_text_init(&w.text, plan->cx);
    if ((st = bs_new(plan->cx, scratch, 3 * atoms + 1, &w.at)) == BS_OK &&
        (st = bs_new(plan->cx, scratch, plan->mol->bond_count, &w.number)) == BS_OK &&
        (st = bs_new(plan->cx, scratch, 2 * (size_t)plan->piece_count, &pieces)) == BS_OK) {
        w.stack = w.at + atoms;
        st = write_pieces(&w, pieces);
    }
    if (st == BS_OK) {
        if (sorted && plan->piece_count > 1)
            sort_pieces(w.text.data, pieces, pieces + plan->piece_count, plan->piece_count);
        st = assemble(&w, pieces, home, out, order, at);
    }
    bs_text_free(&w.text);
    return st;
}

bs_status bs_smiles_write(bs_ctx *cx, bs_arena *home, const bs_mol *mol, unsigned flags, char **out)
{
    smiles_plan plan = {.cx = cx, .mol = mol, .flags = flags};
    bs_mark kept = bs_arena_mark(home);
    bs_mark temp = bs_arena_mark(&cx->scratch);
    int *rank;
    bs_status st;

    *out = NULL;
    if ((st = bs_new(cx, &cx->scratch, mol->atom_count, &rank)) == BS_OK) {
        for (uint32_t i = 0; i < mol->atom_count; i++)
            rank[i] = (int)i;
        plan.rank = rank;
        if ((st = smiles_plan_make(&plan)) == BS_OK)
            st = smiles_write_plan(&plan, false, home, out, NULL, NULL);
    }
    if (home != &cx->scratch)
        bs_arena_rewind(&cx->scratch, temp);
    if (st != BS_OK)
        bs_arena_rewind(home, kept);
    return st;
}
