/* Reads the expressions of SMARTS: brackets, bare symbols and bonds. */
#include "match/parse.h"

#include <stdio.h>
#include <string.h>

bs_status bs_parse__fail(bs_parse *p, size_t at, bs_status code, const char *message)
{
    return bs_fail_at(p->cx, code, p->base + at, "%s", message);
}

bs_status bs_parse__expected(bs_parse *p, const char *what)
{
    int c = bs_parse__peek(p);

    if (c < 0)
        return bs_fail_at(p->cx, BS_ESYNTAX, p->base + p->at, "expected %s, found the end", what);
    if (c < 32 || c > 126)
        return bs_fail_at(p->cx, BS_ESYNTAX, p->base + p->at, "expected %s, found byte 0x%02X",
                          what, (unsigned)c);
    return bs_fail_at(p->cx, BS_ESYNTAX, p->base + p->at, "expected %s, found '%c'", what, c);
}

static bool is_digit(int c)
{
    return c >= '0' && c <= '9';
}

bs_status bs_parse__number(bs_parse *p, int limit, int *value, bool *found)
{
    size_t start = p->at;
    int number = 0;

    for (; is_digit(bs_parse__peek(p)); p->at++) {
        number = number * 10 + (p->text[p->at] - '0');
        if (number > limit)
            return bs_fail_at(p->cx, BS_EVALUE, p->base + start, "a number above %d", limit);
    }
    *found = p->at > start;
    if (*found)
        *value = number;
    return BS_OK;
}

static bs_status emit(bs_parse *p, bs_test_kind kind, int value)
{
    if (p->test_count == p->test_room) {
        int room = p->test_room ? p->test_room * 2 : 32;
        bs_test *wide;
        bs_status st = bs_new(p->cx, &p->cx->scratch, room, &wide);

        if (st != BS_OK)
            return st;
        if (p->test_count > 0)
            memcpy(wide, p->tests, (size_t)p->test_count * sizeof *wide);
        p->tests = wide;
        p->test_room = room;
    }
    p->tests[p->test_count++] = (bs_test){(uint8_t)kind, (int16_t)value};
    return BS_OK;
}

bs_status bs_parse__take(bs_parse *p, int height, bs_query_expr *out)
{
    int count = p->test_count - height;
    bs_status st = bs_new(p->cx, p->home, count, &out->tests);

    if (st != BS_OK)
        return st;
    memcpy(out->tests, p->tests + height, (size_t)count * sizeof *out->tests);
    out->count = count;
    p->test_count = height;
    return BS_OK;
}

/* ---- Logic: ! before & before , before ; ------------------------------------------------- */

/* What the four levels are made of: tests of atoms or of bonds. */
typedef struct alphabet {
    bool (*starts)(const bs_parse *p);
    bs_status (*primitive)(bs_parse *p);
} alphabet;

static bs_status read_not(bs_parse *p, const alphabet *words)
{
    int height = 0;
    bs_status st;

    for (; bs_parse__peek(p) == '!'; p->at++)
        height++;
    if ((st = words->primitive(p)) != BS_OK)
        return st;
    while (height-- > 0)
        if ((st = emit(p, BS_TEST_NOT, 0)) != BS_OK)
            return st;
    return BS_OK;
}

/* Tests that follow each other without an operator are joined by and. */
static bs_status read_and(bs_parse *p, const alphabet *words)
{
    bs_status st = read_not(p, words);

    while (st == BS_OK) {
        if (bs_parse__peek(p) == '&')
            p->at++;
        else if (!words->starts(p))
            break;
        st = read_not(p, words);
        if (st == BS_OK)
            st = emit(p, BS_TEST_AND, 0);
    }
    return st;
}

static bs_status read_or(bs_parse *p, const alphabet *words)
{
    bs_status st = read_and(p, words);

    while (st == BS_OK && bs_parse__peek(p) == ',') {
        p->at++;
        st = read_and(p, words);
        if (st == BS_OK)
            st = emit(p, BS_TEST_OR, 0);
    }
    return st;
}

static bs_status read_logic(bs_parse *p, const alphabet *words)
{
    bs_status st = read_or(p, words);

    while (st == BS_OK && bs_parse__peek(p) == ';') {
        p->at++;
        st = read_or(p, words);
        if (st == BS_OK)
            st = emit(p, BS_TEST_AND, 0);
    }
    return st;
}

/* ---- Bonds ----------------------------------------------------------------------------- */

bool bs_parse__starts_bond(const bs_parse *p)
{
    int c = bs_parse__peek(p);

    return c > 0 && strchr("-=#$:~@/\\!", c) != NULL;
}

static bs_status read_bond_test(bs_parse *p)
{
    static const char symbols[] = "-=#$:~@/\\";
    static const uint8_t kinds[] = {
        BS_TEST_BOND_SINGLE,    BS_TEST_BOND_DOUBLE,   BS_TEST_BOND_TRIPLE,
        BS_TEST_BOND_QUADRUPLE, BS_TEST_BOND_AROMATIC, BS_TEST_BOND_ANY,
        BS_TEST_BOND_RING,      BS_TEST_BOND_UP,       BS_TEST_BOND_DOWN,
    };
    int c = bs_parse__peek(p), value = 0;
    const char *place = c > 0 ? strchr(symbols, c) : NULL;

    if (!place)
        return bs_parse__expected(p, "a bond (- = # $ : ~ @ / \\)");
    p->at++;
    if ((c == '/' || c == '\\') && bs_parse__peek(p) == '?') {
        p->at++;
        value = 1;
    }
    return emit(p, kinds[place - symbols], value);
}

bs_status bs_parse__bond(bs_parse *p, bs_query_expr *out)
{
    static const alphabet words = {bs_parse__starts_bond, read_bond_test};
    int height = p->test_count;
    bs_status st = read_logic(p, &words);

    return st == BS_OK ? bs_parse__take(p, height, out) : st;
}

/* ---- Atom tests ------------------------------------------------------------------------ */

static bool starts_atom_test(const bs_parse *p)
{
    int c = bs_parse__peek(p);

    return c > 0 && !strchr("];,&:)", c);
}

/* A letter and a number; `missing` stands for no number. */
static bs_status read_counted(bs_parse *p, bs_test_kind kind, int missing)
{
    int value = missing;
    bool found;
    bs_status st;

    p->at++;
    if ((st = bs_parse__number(p, BS_QUERY_MAX_NUMBER, &value, &found)) != BS_OK)
        return st;
    return emit(p, kind, value);
}

/* A test whose number must be there: # and ^. */
static bs_status read_numbered(bs_parse *p, bs_test_kind kind, int limit, const char *what)
{
    int value = 0;
    bool found;
    bs_status st;

    p->at++;
    if ((st = bs_parse__number(p, limit, &value, &found)) != BS_OK)
        return st;
    return found ? emit(p, kind, value) : bs_parse__expected(p, what);
}

static bs_status read_charge(bs_parse *p)
{
    int sign = bs_parse__peek(p), value = 1;
    bool found;
    bs_status st;

    for (p->at++; bs_parse__peek(p) == sign; p->at++)
        if (++value > 15)
            return bs_parse__fail(p, p->at, BS_EVALUE, "a charge above 15");
    if (is_digit(bs_parse__peek(p))) {
        if (value > 1)
            return bs_parse__expected(p, "no number behind a repeated sign");
        if ((st = bs_parse__number(p, 15, &value, &found)) != BS_OK)
            return st;
    }
    return emit(p, BS_TEST_CHARGE, sign == '+' ? value : -value);
}

static bool looks_at(const bs_parse *p, const char *word)
{
    size_t length = strlen(word);

    return p->length - p->at >= length && memcmp(p->text + p->at, word, length) == 0;
}

static bs_status read_chirality(bs_parse *p)
{
    static const char *const others[] = {"AL", "SP", "TB", "OH"};
    int value = 1;

    p->at++;
    if (bs_parse__peek(p) == '@') {
        p->at++;
        value = 2;
    } else if (looks_at(p, "TH1") || looks_at(p, "TH2")) {
        value = p->text[p->at + 2] - '0';
        p->at += 3;
    }
    for (int i = 0; i < 4; i++)
        if (looks_at(p, others[i]) && p->length - p->at > 2 && is_digit(p->text[p->at + 2]))
            return bs_parse__fail(p, p->at, BS_EVALUE,
                                  "a pattern can only ask for tetrahedral chirality (@ or @@)");
    if (bs_parse__peek(p) == '?') {
        p->at++;
        value += 2;
    }
    return emit(p, BS_TEST_CHIRAL, value);
}

static bs_status read_recursion(bs_parse *p)
{
    bs_query *outer = p->query, *sub = NULL;
    size_t start = p->at;
    bs_status st;
    int index;

    p->at++;
    if (bs_parse__peek(p) != '(')
        return bs_parse__expected(p, "'(' behind '$'");
    if (p->depth >= BS_QUERY_MAX_DEPTH)
        return bs_fail_at(p->cx, BS_ELIMIT, p->base + start, "recursion nested deeper than %d",
                          BS_QUERY_MAX_DEPTH);
    p->at++;
    p->depth++;
    st = bs_parse__query(p, &sub);
    p->depth--;
    p->query = outer;
    if (st != BS_OK)
        return st;
    if (bs_parse__peek(p) != ')')
        return bs_parse__fail(p, start, BS_ESYNTAX, "'$(' is never closed, expected ')'");
    p->at++;
    if ((st = bs_query_add_sub(p->cx, p->home, outer, sub, &index)) != BS_OK)
        return st;
    return emit(p, BS_TEST_RECURSE, index);
}

/* An element symbol that SMARTS writes with a capital; [Nh] is no nihonium. */
static bool read_element(bs_parse *p, int *element)
{
    const char *at = p->text + p->at;
    size_t left = p->length - p->at;

    if (left >= 2 && at[1] >= 'a' && at[1] <= 'z' && !(at[0] == 'N' && at[1] == 'h')) {
        *element = bs_element_number(at, 2);
        if (*element > 0) {
            p->at += 2;
            return true;
        }
    }
    if (!strchr("BCFIKNOPSUVWY", at[0]))
        return false;
    *element = bs_element_number(at, 1);
    p->at++;
    return *element > 0;
}

/* An aromatic symbol; `bare` leaves out those that need a bracket. */
static bool read_aromatic(bs_parse *p, bool bare, int *element)
{
    static const struct {
        char symbol[3];
        uint8_t element;
    } table[] = {{"se", 34}, {"te", 52}, {"si", 14}, {"as", 33}, {"b", 5},
                 {"c", 6},   {"n", 7},   {"o", 8},   {"p", 15},  {"s", 16}};

    for (size_t i = bare ? 4 : 0; i < sizeof table / sizeof *table; i++)
        if (looks_at(p, table[i].symbol)) {
            *element = table[i].element;
            p->at += strlen(table[i].symbol);
            return true;
        }
    return false;
}

static bs_status read_letter(bs_parse *p)
{
    int c = bs_parse__peek(p), element;

    if (c >= 'A' && c <= 'Z' && read_element(p, &element))
        return emit(p, BS_TEST_ALIPHATIC_ELEM, element);
    if (c >= 'a' && c <= 'z' && read_aromatic(p, false, &element))
        return emit(p, BS_TEST_AROMATIC_ELEM, element);
    switch (c) {
    case 'A':
        p->at++;
        return emit(p, BS_TEST_ALIPHATIC, 0);
    case 'a':
        p->at++;
        return emit(p, BS_TEST_AROMATIC, 0);
    case 'D':
        return read_counted(p, BS_TEST_DEGREE, 1);
    case 'H':
        return read_counted(p, BS_TEST_HYDROGENS, 1);
    case 'h':
        return read_counted(p, BS_TEST_IMPLICIT_H, -1);
    case 'R':
        return read_counted(p, BS_TEST_RING_COUNT, -1);
    case 'r':
        return read_counted(p, BS_TEST_RING_SIZE, -1);
    case 'v':
        return read_counted(p, BS_TEST_VALENCE, 1);
    case 'X':
        return read_counted(p, BS_TEST_CONNECTIONS, 1);
    case 'x':
        return read_counted(p, BS_TEST_RING_BONDS, -1);
    default:
        return bs_parse__expected(p, "an atom test");
    }
}

static bs_status read_atom_test(bs_parse *p)
{
    int c = bs_parse__peek(p), value = 0;
    bool found;
    bs_status st;

    switch (c) {
    case '*':
        p->at++;
        return emit(p, BS_TEST_ANY, 0);
    case '#':
        return read_numbered(p, BS_TEST_ELEMENT, 118, "an atomic number behind '#'");
    case '^':
        return read_numbered(p, BS_TEST_HYBRID, 5, "a number from 0 to 5 behind '^'");
    case '$':
        return read_recursion(p);
    case '+':
    case '-':
        return read_charge(p);
    case '@':
        return read_chirality(p);
    default:
        if (!is_digit(c))
            return read_letter(p);
        if ((st = bs_parse__number(p, BS_QUERY_MAX_NUMBER, &value, &found)) != BS_OK)
            return st;
        return emit(p, BS_TEST_ISOTOPE, value);
    }
}

/* ---- Atoms ----------------------------------------------------------------------------- */

static bs_status read_map(bs_parse *p, int *map)
{
    bool found;
    bs_status st;

    if (bs_parse__peek(p) != ':')
        return BS_OK;
    p->at++;
    if ((st = bs_parse__number(p, INT16_MAX, map, &found)) != BS_OK)
        return st;
    return found ? BS_OK : bs_parse__expected(p, "a map number behind ':'");
}

/* Whether the bracket holds only mass, H, charge and map number, and so a hydrogen atom. */
static bool is_hydrogen_atom(const bs_parse *p)
{
    size_t i = p->at;

    while (i < p->length && is_digit(p->text[i]))
        i++;
    if (i >= p->length || p->text[i++] != 'H')
        return false;
    if (i < p->length && (p->text[i] == '+' || p->text[i] == '-')) {
        for (char sign = p->text[i]; i < p->length && p->text[i] == sign; i++)
            ;
        while (i < p->length && is_digit(p->text[i]))
            i++;
    }
    return i < p->length && (p->text[i] == ']' || p->text[i] == ':');
}

static bs_status read_hydrogen_atom(bs_parse *p)
{
    int isotope = 0, parts = 1;
    bool found;
    bs_status st;

    if ((st = bs_parse__number(p, BS_QUERY_MAX_NUMBER, &isotope, &found)) != BS_OK)
        return st;
    if (found && (st = emit(p, BS_TEST_ISOTOPE, isotope)) != BS_OK)
        return st;
    p->at++;
    if ((st = emit(p, BS_TEST_ELEMENT, 1)) != BS_OK)
        return st;
    parts += found;
    if (bs_parse__peek(p) == '+' || bs_parse__peek(p) == '-') {
        if ((st = read_charge(p)) != BS_OK)
            return st;
        parts++;
    }
    for (; parts > 1 && st == BS_OK; parts--)
        st = emit(p, BS_TEST_AND, 0);
    return st;
}

static bs_status read_bracket(bs_parse *p, bs_query_atom *atom)
{
    static const alphabet words = {starts_atom_test, read_atom_test};
    size_t start = p->at++;
    bs_status st;

    if (is_hydrogen_atom(p))
        st = read_hydrogen_atom(p);
    else
        st = read_logic(p, &words);
    if (st == BS_OK)
        st = read_map(p, &atom->map);
    if (st != BS_OK)
        return st;
    if (bs_parse__peek(p) < 0)
        return bs_parse__fail(p, start, BS_ESYNTAX, "'[' is never closed, expected ']'");
    if (bs_parse__peek(p) != ']')
        return bs_parse__expected(p, "']'");
    p->at++;
    return BS_OK;
}

/* Symbols that need no bracket. */
static bs_status read_bare(bs_parse *p)
{
    int c = bs_parse__peek(p), element;

    if (c == '*' || c == 'a' || c == 'A') {
        p->at++;
        return emit(p, c == '*' ? BS_TEST_ANY : c == 'a' ? BS_TEST_AROMATIC : BS_TEST_ALIPHATIC, 0);
    }
    if (looks_at(p, "Cl") || looks_at(p, "Br")) {
        element = c == 'C' ? 17 : 35;
        p->at += 2;
        return emit(p, BS_TEST_ALIPHATIC_ELEM, element);
    }
    if (c > 0 && strchr("BCNOPSFI", c)) {
        element = bs_element_number(p->text + p->at, 1);
        p->at++;
        return emit(p, BS_TEST_ALIPHATIC_ELEM, element);
    }
    if (read_aromatic(p, true, &element))
        return emit(p, BS_TEST_AROMATIC_ELEM, element);
    return bs_parse__expected(p, "an atom");
}

bs_status bs_parse__atom(bs_parse *p, bs_query_atom *atom)
{
    int height = p->test_count;
    bs_status st;

    memset(atom, 0, sizeof *atom);
    atom->offset = (uint32_t)(p->base + p->at);
    st = bs_parse__peek(p) == '[' ? read_bracket(p, atom) : read_bare(p);
    return st == BS_OK ? bs_parse__take(p, height, &atom->expr) : st;
}
