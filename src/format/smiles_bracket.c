/* Reading bracket atoms: [isotope symbol chirality hydrogens charge class]. */
#include "format/smiles_read.h"

#include <string.h>

static char peek(const smiles_reader *r)
{
    return r->at < r->length ? r->text[r->at] : '\0';
}

static bool at_digit(const smiles_reader *r)
{
    return peek(r) >= '0' && peek(r) <= '9';
}

/* Reads digits; a number above `limit` is refused. */
static bs_status read_number(smiles_reader *r, uint32_t limit, const char *what, uint32_t *number)
{
    uint32_t start = r->at;

    *number = 0;
    for (; at_digit(r); r->at++) {
        *number = *number * 10 + (uint32_t)(peek(r) - '0');
        if (*number > limit)
            return bs_fail_at(r->cx, BS_ELIMIT, start, "%s above %lu", what, (unsigned long)limit);
    }
    return BS_OK;
}

static bs_status read_symbol(smiles_reader *r, bs_draft_atom *atom)
{
    static const struct {
        char symbol[3];
        uint8_t element;
    } aromatic[] = {{"se", 34}, {"as", 33}, {"te", 52}, {"si", 14}, {"b", 5},
                    {"c", 6},   {"n", 7},   {"o", 8},   {"p", 15},  {"s", 16}};
    const char *t = r->text + r->at;
    size_t left = r->length - r->at;
    int element = -1;
    uint32_t width = 1;

    if (left >= 1 && t[0] == '*') {
        r->at++;
        return BS_OK;
    }
    for (size_t i = 0; i < sizeof aromatic / sizeof aromatic[0]; i++) {
        size_t n = strlen(aromatic[i].symbol);

        if (left >= n && memcmp(t, aromatic[i].symbol, n) == 0) {
            atom->element = aromatic[i].element;
            atom->aromatic = true;
            r->at += (uint32_t)n;
            return BS_OK;
        }
    }
    if (left >= 1 && t[0] >= 'A' && t[0] <= 'Z') {
        if (left >= 2 && t[1] >= 'a' && t[1] <= 'z') {
            width = 2;
            element = bs_element_number(t, 2);
        } else {
            element = bs_element_number(t, 1);
        }
    }
    if (element < 1)
        return smiles_unexpected(r, r->at, "the symbol of an element");
    atom->element = (uint8_t)element;
    r->at += width;
    return BS_OK;
}

/* Reads the class and number behind an @, as in @TB12. */
static bs_status read_class(smiles_reader *r, smiles_atom *beside)
{
    static const struct {
        char name[3];
        uint8_t kind;
        uint8_t most;
    } classes[] = {{"TH", BS_STEREO_TETRAHEDRAL, 2},
                   {"AL", BS_STEREO_ALLENE, 2},
                   {"SP", BS_STEREO_SQUARE, 3},
                   {"TB", BS_STEREO_TRIGONAL_BIPYRAMID, 20},
                   {"OH", BS_STEREO_OCTAHEDRON, 30}};

    for (size_t i = 0; i < sizeof classes / sizeof classes[0]; i++) {
        uint32_t at = r->at + 2;
        uint32_t number;
        bs_status st;

        if (r->length - r->at < 2 || memcmp(r->text + r->at, classes[i].name, 2) != 0)
            continue;
        r->at = at;
        if (!at_digit(r))
            return smiles_unexpected(r, at, "the number of a chirality class");
        if ((st = read_number(r, 99, "a chirality class", &number)) != BS_OK)
            return st;
        if (number < 1 || number > classes[i].most)
            return bs_fail_at(r->cx, BS_EVALUE, at, "@%s goes from 1 to %d", classes[i].name,
                              classes[i].most);
        beside->kind = classes[i].kind;
        beside->perm = (uint8_t)number;
        return BS_OK;
    }
    beside->kind = SMILES_BARE_MARK;
    beside->perm = 1;
    return BS_OK;
}

static bs_status read_chirality(smiles_reader *r, smiles_atom *beside)
{
    if (peek(r) != '@')
        return BS_OK;
    r->at++;
    if (peek(r) == '@') {
        r->at++;
        beside->kind = SMILES_BARE_MARK;
        beside->perm = 2;
        return BS_OK;
    }
    return read_class(r, beside);
}

static bs_status read_hydrogens(smiles_reader *r, bs_draft_atom *atom)
{
    atom->hydrogens = 0;
    if (peek(r) != 'H')
        return BS_OK;
    if (atom->element == 1)
        return bs_fail_at(r->cx, BS_EVALUE, r->at, "a hydrogen cannot have a hydrogen count");
    r->at++;
    atom->hydrogens = 1;
    if (at_digit(r)) {
        atom->hydrogens = (int16_t)(peek(r) - '0');
        r->at++;
    }
    return BS_OK;
}

static bs_status read_charge(smiles_reader *r, bs_draft_atom *atom)
{
    uint32_t start = r->at;
    char sign = peek(r);
    uint32_t charge = 1;
    bs_status st;

    if (sign != '+' && sign != '-')
        return BS_OK;
    r->at++;
    if (at_digit(r)) {
        if ((st = read_number(r, 99, "a charge", &charge)) != BS_OK)
            return st;
    } else {
        for (; peek(r) == sign; r->at++)
            charge++;
        if (charge > 99)
            return bs_fail_at(r->cx, BS_ELIMIT, start, "a charge above 99");
    }
    atom->charge = (int8_t)(sign == '+' ? (int)charge : -(int)charge);
    return BS_OK;
}

static bs_status read_label(smiles_reader *r, bs_draft_atom *atom)
{
    uint32_t label;
    bs_status st;

    if (peek(r) != ':')
        return BS_OK;
    r->at++;
    if (!at_digit(r))
        return smiles_unexpected(r, r->at, "the number of an atom class");
    if ((st = read_number(r, UINT16_MAX, "an atom class", &label)) == BS_OK)
        atom->label = (uint16_t)label;
    return st;
}

bs_status smiles_read_bracket(smiles_reader *r, bs_draft_atom *atom, smiles_atom *beside)
{
    uint32_t isotope;
    bs_status st;

    r->at++;
    if ((st = read_number(r, 999, "an isotope", &isotope)) != BS_OK)
        return st;
    atom->isotope = (uint16_t)isotope;
    if ((st = read_symbol(r, atom)) != BS_OK || (st = read_chirality(r, beside)) != BS_OK ||
        (st = read_hydrogens(r, atom)) != BS_OK || (st = read_charge(r, atom)) != BS_OK ||
        (st = read_label(r, atom)) != BS_OK)
        return st;
    if (peek(r) != ']')
        return smiles_unexpected(r, r->at, "the end ']' of a bracket atom");
    r->at++;
    return BS_OK;
}
