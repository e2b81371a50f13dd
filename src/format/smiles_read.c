/*
 * Reading SMILES: the grammar of OpenSMILES, one character at a time and without recursion.
 *
 * Beside the specification: a ring digit may follow a branch, +++ and the like are read as charges,
 * and [te] is aromatic, as is [si].
 */
#include "format/smiles_read.h"

#include <string.h>

/* What has just been read, and so what may follow. */
typedef enum state {
    AT_START,
    AFTER_ATOM,
    AFTER_BOND,
    AFTER_DOT,
    AFTER_OPEN,
    AFTER_OPEN_BOND
} state;

bs_status smiles_unexpected(smiles_reader *r, uint32_t at, const char *expected)
{
    if (at >= r->length)
        return bs_fail_at(r->cx, BS_ESYNTAX, at, "the SMILES ends where %s was expected", expected);
    return bs_fail_at(r->cx, BS_ESYNTAX, at, "'%c' where %s was expected", r->text[at], expected);
}

static bool is_bond_symbol(char c)
{
    return c == '=' || c == '-' || c == '#' || c == ':' || c == '/' || c == '\\' || c == '$';
}

/* Order of a bond between two atoms for a symbol, 0 where none was written. */
static int order_of(const smiles_reader *r, char symbol, uint32_t a, uint32_t b)
{
    const bs_draft_atom *x = &r->draft.atoms[a];
    const bs_draft_atom *y = &r->draft.atoms[b];

    switch (symbol) {
    case '=':
        return 2;
    case '#':
        return 3;
    case '$':
        return 4;
    case ':':
        return BS_DRAFT_ORDER_AROMATIC;
    case 0:
        /* An unknown atom may be part of an aromatic ring. */
        if ((x->aromatic && (y->aromatic || y->element == 0)) || (y->aromatic && x->element == 0))
            return BS_DRAFT_ORDER_AROMATIC;
        return 1;
    default:
        return 1;
    }
}

static bs_status add_bond(smiles_reader *r, uint32_t a, uint32_t b, char symbol, uint32_t place_a,
                          uint32_t place_b)
{
    uint32_t index;
    bs_status st = bs_draft_add_bond(&r->draft, a, b, order_of(r, symbol, a, b), &index);

    if (st != BS_OK)
        return st;
    r->bonds[index] = (smiles_bond){place_a, place_b, 0};
    if (symbol == '/' || symbol == '\\') {
        r->bonds[index].mark = symbol;
        r->has_slants = true;
    }
    return BS_OK;
}

/* ---- Atoms ---------------------------------------------------------------------------------- */

/* Reads a symbol of the organic subset; 0 if there is none here. */
static int read_organic(smiles_reader *r, bool *aromatic)
{
    char c = r->text[r->at];
    char next = r->at + 1 < r->length ? r->text[r->at + 1] : '\0';

    *aromatic = false;
    r->at++;
    if ((c == 'C' && next == 'l') || (c == 'B' && next == 'r')) {
        r->at++;
        return c == 'C' ? 17 : 35;
    }
    switch (c) {
    case 'B':
        return 5;
    case 'C':
        return 6;
    case 'N':
        return 7;
    case 'O':
        return 8;
    case 'F':
        return 9;
    case 'P':
        return 15;
    case 'S':
        return 16;
    case 'I':
        return 53;
    }
    *aromatic = true;
    switch (c) {
    case 'b':
        return 5;
    case 'c':
        return 6;
    case 'n':
        return 7;
    case 'o':
        return 8;
    case 'p':
        return 15;
    case 's':
        return 16;
    }
    r->at--;
    return 0;
}

static bs_status read_atom(smiles_reader *r)
{
    bs_draft_atom atom = {.hydrogens = BS_DRAFT_IMPLIED};
    smiles_atom beside = {.at = r->at};
    uint32_t index;
    bs_status st;

    if (r->text[r->at] == '[') {
        if ((st = smiles_read_bracket(r, &atom, &beside)) != BS_OK)
            return st;
    } else if (r->text[r->at] == '*') {
        r->at++;
        atom.hydrogens = 0;
    } else {
        int element = read_organic(r, &atom.aromatic);

        if (element == 0)
            return smiles_unexpected(r, r->at, "an atom");
        atom.element = (uint8_t)element;
    }
    if ((st = bs_draft_add_atom(&r->draft, atom, &index)) != BS_OK)
        return st;
    r->atoms[index] = beside;
    r->has_marks |= beside.kind != BS_STEREO_NONE;
    if (r->last != UINT32_MAX)
        st = add_bond(r, r->last, index, r->symbol, beside.at, 0);
    r->last = index;
    r->symbol = 0;
    return st;
}

/* ---- Rings ---------------------------------------------------------------------------------- */

static bs_status read_ring_number(smiles_reader *r, int *number)
{
    const char *t = r->text + r->at;
    uint32_t left = r->length - r->at;

    if (*t != '%') {
        *number = *t - '0';
        r->at++;
        return BS_OK;
    }
    for (uint32_t k = 1; k <= 2; k++) {
        if (k >= left || t[k] < '0' || t[k] > '9')
            return smiles_unexpected(r, r->at + k, "the two digits of a ring number");
    }
    *number = (t[1] - '0') * 10 + (t[2] - '0');
    r->at += 3;
    return BS_OK;
}

/* The symbol of a ring bond as written from the first end, out of what both ends say. */
static bs_status join_symbols(smiles_reader *r, const smiles_ring *ring, char *symbol)
{
    char second = r->symbol;

    if (second == '/' || second == '\\')
        second = second == '/' ? '\\' : '/';
    *symbol = ring->symbol ? ring->symbol : second;
    if (ring->symbol != 0 && second != 0 && ring->symbol != second)
        return bs_fail_at(r->cx, BS_ESYNTAX, r->symbol_at,
                          "the bond symbols at the two ends of a ring closure disagree");
    return BS_OK;
}

static bs_status read_ring(smiles_reader *r)
{
    uint32_t at = r->at;
    smiles_ring *ring;
    int number = 0;
    char symbol;
    uint32_t first;
    bs_status st = read_ring_number(r, &number);

    if (st != BS_OK)
        return st;
    ring = &r->rings[number];
    if (ring->atom == 0) {
        *ring = (smiles_ring){r->last + 1, at, r->symbol};
        r->symbol = 0;
        return BS_OK;
    }
    first = ring->atom - 1;
    if (first == r->last)
        return bs_fail_at(r->cx, BS_ESYNTAX, at, "ring closure %d joins an atom to itself", number);
    if ((st = join_symbols(r, ring, &symbol)) != BS_OK)
        return st;
    st = add_bond(r, first, r->last, symbol, ring->at, at);
    ring->atom = 0;
    r->symbol = 0;
    return st;
}

static bs_status check_closed(smiles_reader *r)
{
    uint32_t least = UINT32_MAX;
    int number = 0;

    if (r->depth > 0)
        return bs_fail_at(r->cx, BS_ESYNTAX, r->branches[r->depth - 1].at,
                          "this branch is never closed");
    for (int i = 0; i < SMILES_RINGS; i++) {
        if (r->rings[i].atom != 0 && r->rings[i].at < least) {
            least = r->rings[i].at;
            number = i;
        }
    }
    if (least != UINT32_MAX)
        return bs_fail_at(r->cx, BS_ESYNTAX, least, "ring %d is never closed", number);
    return BS_OK;
}

/* ---- The string ----------------------------------------------------------------------------- */

static bs_status open_branch(smiles_reader *r)
{
    r->branches[r->depth++] = (smiles_branch){r->last, r->at};
    r->at++;
    return BS_OK;
}

static bs_status close_branch(smiles_reader *r)
{
    if (r->depth == 0)
        return bs_fail_at(r->cx, BS_ESYNTAX, r->at, "')' closes a branch that was never opened");
    r->last = r->branches[--r->depth].atom;
    r->at++;
    return BS_OK;
}

/* Reads what may follow an atom, a ring digit or a branch. */
static bs_status read_after_atom(smiles_reader *r, state *now)
{
    char c = r->text[r->at];

    if (c == '(') {
        *now = AFTER_OPEN;
        return open_branch(r);
    }
    if (c == ')')
        return close_branch(r);
    if ((c >= '0' && c <= '9') || c == '%')
        return read_ring(r);
    if (c == '.') {
        r->last = UINT32_MAX;
        r->at++;
        *now = AFTER_DOT;
        return BS_OK;
    }
    if (is_bond_symbol(c)) {
        r->symbol = c;
        r->symbol_at = r->at++;
        *now = AFTER_BOND;
        return BS_OK;
    }
    return read_atom(r);
}

static bs_status read_item(smiles_reader *r, state *now)
{
    char c = r->text[r->at];

    switch (*now) {
    case AFTER_ATOM:
        return read_after_atom(r, now);
    case AFTER_OPEN:
        if (c == '.') {
            r->last = UINT32_MAX;
            r->at++;
            *now = AFTER_DOT;
            return BS_OK;
        }
        if (is_bond_symbol(c)) {
            r->symbol = c;
            r->symbol_at = r->at++;
            *now = AFTER_OPEN_BOND;
            return BS_OK;
        }
        break;
    case AFTER_BOND:
        if ((c >= '0' && c <= '9') || c == '%') {
            *now = AFTER_ATOM;
            return read_ring(r);
        }
        break;
    default:
        break;
    }
    *now = AFTER_ATOM;
    return read_atom(r);
}

static bs_status read_string(smiles_reader *r)
{
    state now = AT_START;
    bs_status st;

    while (r->at < r->length) {
        if ((r->at & 0xffff) == 0xffff && (st = bs_poll(r->cx)) != BS_OK)
            return st;
        if ((st = read_item(r, &now)) != BS_OK)
            return st;
    }
    if (now != AFTER_ATOM)
        return smiles_unexpected(r, r->length, "an atom");
    return check_closed(r);
}

/* The string ends at white space or a NUL; says how many branches open before. */
static size_t measure(const char *text, size_t length, size_t *branches)
{
    size_t end = 0;

    *branches = 0;
    while (end < length && text[end] != '\0' && !strchr(" \t\r\n\v\f", text[end]))
        *branches += text[end++] == '(';
    return end;
}

static bs_status prepare(smiles_reader *r, size_t branches)
{
    bs_arena *scratch = &r->cx->scratch;
    uint32_t room = r->length + 1;
    bs_status st;

    bs_draft_init(&r->draft, r->cx, scratch);
    if ((st = bs_draft__reserve(&r->draft, room, room)) != BS_OK ||
        (st = bs_new(r->cx, scratch, room, &r->atoms)) != BS_OK ||
        (st = bs_new(r->cx, scratch, room, &r->bonds)) != BS_OK)
        return st;
    return bs_new(r->cx, scratch, branches, &r->branches);
}

bs_status bs_smiles_read(bs_ctx *cx, bs_arena *home, const char *text, size_t length, size_t *used,
                         bs_mol **out)
{
    smiles_reader r = {.cx = cx, .text = text, .last = UINT32_MAX};
    bs_mark temp = bs_arena_mark(&cx->scratch);
    size_t branches;
    size_t end = measure(text, length, &branches);
    bs_status st;

    *out = NULL;
    if (used)
        *used = end;
    if (end > INT32_MAX)
        return bs_fail(cx, BS_ELIMIT, "a SMILES of more than %d bytes", INT32_MAX);
    r.length = (uint32_t)end;
    if ((st = prepare(&r, branches)) == BS_OK && (st = read_string(&r)) == BS_OK &&
        (st = smiles_read_stereo(&r)) == BS_OK) {
        st = bs_draft_finish(&r.draft, home, NULL, out);
        if (st != BS_OK && cx->error.offset >= 0)
            cx->error.offset = (long)r.atoms[cx->error.offset].at;
    }
    if (home != &cx->scratch || st != BS_OK)
        bs_arena_rewind(&cx->scratch, temp);
    return st;
}
