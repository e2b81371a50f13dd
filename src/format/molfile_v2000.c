/* The blocks of a V2000 molfile: fixed columns, then property lines. */
#include "chem/element.h"
#include "format/molfile.h"

#include <math.h>
#include <string.h>

typedef struct v2000 {
    bs_molfile *file;
    bs_scan *scan;
    bool end_may_lack;    /* files from before there were versions have no M  END */
    bool cleared_charges; /* M  CHG and M  RAD take the place of the atom block's charges */
    bool cleared_isotopes;
} v2000;

/* ---- Atoms --------------------------------------------------------------------------------- */

static bs_status read_place(const bs_scan *scan, size_t column, double *out)
{
    size_t start = column;
    size_t width = 10;

    while (width > 0 && scan->at[start] == ' ') {
        start++;
        width--;
    }
    while (width > 0 && scan->at[start + width - 1] == ' ')
        width--;
    if (bs_scan__double(scan->at + start, width, out) && fabs(*out) <= BS_MOLFILE_PLACE_MAX)
        return BS_OK;
    return bs_scan__fail(scan, BS_ESYNTAX, column, 10,
                         "'%.*s' stands where a coordinate such as "
                         "1.2500 was expected",
                         (int)width, scan->at + start);
}

static bs_status read_symbol(const bs_scan *scan, bs_molfile_atom *atom)
{
    const char *text = scan->at + 31;
    size_t length = scan->size - 31 < 3 ? scan->size - 31 : 3;

    while (length > 0 && text[length - 1] == ' ')
        length--;
    while (length > 0 && *text == ' ') {
        text++;
        length--;
    }
    if (bs_molfile__symbol(text, length, atom))
        return BS_OK;
    return bs_scan__fail(scan, BS_EVALUE, 31, 3, "'%.*s' is %s", (int)length, text,
                         bs_molfile__symbol_trouble(text, length));
}

/* A mass difference counts from the rounded atomic weight. */
static bs_status set_mass_difference(const bs_scan *scan, bs_molfile_atom *atom, long difference)
{
    double weight = bs_element__weight(atom->element);
    long mass = lround(weight) + difference;

    if (difference == 0 || atom->isotope != 0)
        return BS_OK;
    if (weight <= 0 || mass < 1)
        return bs_scan__fail(scan, BS_EVALUE, 34, 2, "a mass difference of %ld has no meaning here",
                             difference);
    atom->isotope = (uint16_t)mass;
    return BS_OK;
}

static bs_status read_atom_fields(const bs_scan *scan, bs_molfile_atom *atom)
{
    static const int8_t charges[] = {0, 3, 2, 1, 0, -1, -2, -3};
    long value;
    bs_status st;

    if ((st = bs_scan__column(scan, 34, 2, -9, 12, "a mass difference", &value)) != BS_OK ||
        (st = set_mass_difference(scan, atom, value)) != BS_OK ||
        (st = bs_scan__column(scan, 36, 3, 0, 7, "a charge code", &value)) != BS_OK)
        return st;
    atom->charge = charges[value];
    atom->radical = value == 4 ? 2 : 0;
    if ((st = bs_scan__column(scan, 39, 3, 0, 3, "a parity", &value)) != BS_OK)
        return st;
    atom->parity = (uint8_t)(value < 3 ? value : 0);
    if ((st = bs_scan__column(scan, 42, 3, 0, 99, "a hydrogen count", &value)) != BS_OK)
        return st;
    atom->hydrogens = (int16_t)(value - 1);
    if ((st = bs_scan__column(scan, 48, 3, 0, 15, "a valence", &value)) != BS_OK)
        return st;
    atom->valence = (int16_t)(value == 0 ? -1 : value == 15 ? 0 : value);
    if ((st = bs_scan__column(scan, 60, 3, 0, 999, "an atom mapping number", &value)) != BS_OK)
        return st;
    if (value > 0)
        atom->label = (uint16_t)value;
    return BS_OK;
}

static bs_status read_atom(const bs_scan *scan, bs_molfile_atom *atom)
{
    bs_status st;

    if (scan->size < 32)
        return bs_scan__fail(scan, BS_ESYNTAX, 0, 0,
                             "an atom line was expected: x, y and z in "
                             "columns 1 to 30, the symbol in 32 to 34");
    atom->line = scan->line;
    if ((st = read_place(scan, 0, &atom->x)) != BS_OK ||
        (st = read_place(scan, 10, &atom->y)) != BS_OK ||
        (st = read_place(scan, 20, &atom->z)) != BS_OK || (st = read_symbol(scan, atom)) != BS_OK)
        return st;
    return read_atom_fields(scan, atom);
}

/* ---- Bonds --------------------------------------------------------------------------------- */

static bs_status read_bond(const bs_molfile *file, const bs_scan *scan, bs_molfile_bond *bond)
{
    long a;
    long b;
    long type;
    long mark;
    bs_status st;

    if (scan->size < 7)
        return bs_scan__fail(scan, BS_ESYNTAX, 0, 0,
                             "a bond line was expected: two atom numbers "
                             "and the type, three columns each");
    if ((st = bs_scan__column(scan, 0, 3, 1, file->atom_count, "an atom number", &a)) != BS_OK ||
        (st = bs_scan__column(scan, 3, 3, 1, file->atom_count, "an atom number", &b)) != BS_OK ||
        (st = bs_scan__column(scan, 6, 3, 0, 999, "a bond type", &type)) != BS_OK ||
        (st = bs_molfile__check_type(scan, 6, 3, type)) != BS_OK ||
        (st = bs_scan__column(scan, 9, 3, 0, 6, "a bond stereo code", &mark)) != BS_OK)
        return st;
    if (a < 1 || b < 1)
        return bs_scan__fail(scan, BS_ESYNTAX, a < 1 ? 0 : 3, 3,
                             "an atom number (1 to %u) was "
                             "expected",
                             (unsigned)file->atom_count);
    if (a == b)
        return bs_scan__fail(scan, BS_EVALUE, 0, 6, "atom %ld is bonded to itself", a);
    *bond = (bs_molfile_bond){.a = (uint32_t)a - 1, .b = (uint32_t)b - 1, .type = (uint8_t)type};
    bond->line = scan->line;
    bond->mark = mark == 1   ? BS_MARK_UP
                 : mark == 6 ? BS_MARK_DOWN
                 : mark != 0 ? BS_MARK_EITHER
                             : BS_MARK_NONE;
    return BS_OK;
}

/* ---- Property lines ------------------------------------------------------------------------ */

static void clear_charges(v2000 *v)
{
    if (v->cleared_charges)
        return;
    v->cleared_charges = true;
    for (uint32_t i = 0; i < v->file->atom_count; i++) {
        v->file->atoms[i].charge = 0;
        v->file->atoms[i].radical = 0;
    }
}

/* The mass differences of the atom block; D and T keep their isotope. */
static void clear_isotopes(v2000 *v)
{
    if (v->cleared_isotopes)
        return;
    v->cleared_isotopes = true;
    for (uint32_t i = 0; i < v->file->atom_count; i++) {
        if (v->file->atoms[i].element != 1)
            v->file->atoms[i].isotope = 0;
    }
}

typedef enum property {
    PROPERTY_CHARGE,
    PROPERTY_ISOTOPE,
    PROPERTY_RADICAL,
    PROPERTY_GROUP
} property;

static const struct {
    const char *word;
    long low, high;
    const char *what;
} properties[] = {
    {"M  CHG", -15, 15, "a charge"},
    {"M  ISO", 0, 999, "a mass number"},
    {"M  RAD", 0, 3, "a radical code"},
    {"M  RGP", 0, 999, "an R group number"},
};

static void set_property(bs_molfile_atom *atom, property kind, long value)
{
    switch (kind) {
    case PROPERTY_CHARGE:
        atom->charge = (int8_t)value;
        break;
    case PROPERTY_ISOTOPE:
        atom->isotope = (uint16_t)value;
        break;
    case PROPERTY_RADICAL:
        atom->radical = (uint8_t)value;
        break;
    case PROPERTY_GROUP:
        atom->label = (uint16_t)value;
        break;
    }
}

/* Pairs of an atom number and a value, four columns each, up to eight of them. */
static bs_status read_pairs(v2000 *v, property kind)
{
    const bs_scan *scan = v->scan;
    long count;
    bs_status st = bs_scan__column(scan, 6, 3, 0, 999, "the number of entries", &count);

    if (st != BS_OK)
        return st;
    if (kind == PROPERTY_CHARGE || kind == PROPERTY_RADICAL)
        clear_charges(v);
    if (kind == PROPERTY_ISOTOPE)
        clear_isotopes(v);
    for (long i = 0; i < count; i++) {
        size_t column = 9 + 8 * (size_t)i;
        long atom;
        long value;

        if (scan->size <= column + 4)
            return bs_scan__fail(scan, BS_ESYNTAX, 6, 3,
                                 "%ld entries are announced, the line has "
                                 "%ld",
                                 count, i);
        if ((st = bs_scan__column(scan, column, 4, 1, v->file->atom_count, "an atom number",
                                  &atom)) != BS_OK ||
            (st = bs_scan__column(scan, column + 4, 4, properties[kind].low, properties[kind].high,
                                  properties[kind].what, &value)) != BS_OK)
            return st;
        if (atom < 1)
            return bs_scan__fail(scan, BS_ESYNTAX, column, 4, "an atom number was expected");
        set_property(&v->file->atoms[atom - 1], kind, value);
    }
    return BS_OK;
}

static bs_status skip_lines(v2000 *v, long count)
{
    bs_status st = BS_OK;

    for (long i = 0; i < count && st == BS_OK; i++)
        st = bs_scan__need_line(v->scan, "a property line");
    return st;
}

static bool is_blank(const bs_scan *scan)
{
    for (size_t i = 0; i < scan->size; i++) {
        if (scan->at[i] != ' ')
            return false;
    }
    return true;
}

static bs_status read_property(v2000 *v)
{
    long count;
    bs_status st;

    for (int kind = PROPERTY_CHARGE; kind <= PROPERTY_GROUP; kind++) {
        if (bs_scan__starts(v->scan, properties[kind].word))
            return read_pairs(v, (property)kind);
    }
    if (bs_scan__starts(v->scan, "M  ALS"))
        return bs_scan__fail(v->scan, BS_EVALUE, 0, 6,
                             "a list of elements; a molecule has one "
                             "element at each place");
    if (bs_scan__starts(v->scan, "A  ") || bs_scan__starts(v->scan, "G  "))
        return skip_lines(v, 1);
    if (bs_scan__starts(v->scan, "S  SKP")) {
        st = bs_scan__column(v->scan, 6, 3, 0, 999, "a number of lines", &count);
        return st == BS_OK ? skip_lines(v, count) : st;
    }
    if (bs_scan__starts(v->scan, "M  ") || bs_scan__starts(v->scan, "V  ") || is_blank(v->scan))
        return BS_OK;
    return bs_scan__fail(v->scan, BS_ESYNTAX, 0, 0,
                         "a property line or M  END was expected; the "
                         "counts of atoms and bonds may be wrong");
}

static bs_status read_properties(v2000 *v)
{
    bs_status st = BS_OK;

    while (st == BS_OK) {
        if (!bs_scan__line(v->scan)) {
            if (v->end_may_lack)
                return BS_OK;
            return bs_scan__need_line(v->scan, "M  END");
        }
        if (bs_scan__starts(v->scan, "M  END"))
            return BS_OK;
        st = read_property(v);
    }
    return st;
}

/* ---- All together -------------------------------------------------------------------------- */

static bs_status read_blocks(v2000 *v, long texts)
{
    bs_molfile *file = v->file;
    bs_status st = BS_OK;

    for (uint32_t i = 0; i < file->atom_count && st == BS_OK; i++) {
        if ((st = bs_scan__need_line(v->scan, "an atom line")) == BS_OK)
            st = read_atom(v->scan, &file->atoms[i]);
    }
    for (uint32_t i = 0; i < file->bond_count && st == BS_OK; i++) {
        if ((st = bs_scan__need_line(v->scan, "a bond line")) == BS_OK)
            st = read_bond(file, v->scan, &file->bonds[i]);
    }
    return st == BS_OK ? skip_lines(v, texts) : st;
}

bs_status bs_molfile__read_v2000(bs_molfile *file, bs_scan *scan)
{
    v2000 v = {.file = file, .scan = scan};
    long atoms;
    long bonds;
    long lists;
    long chiral;
    long texts;
    bs_status st;

    if (scan->size < 6)
        return bs_scan__fail(scan, BS_ESYNTAX, 0, 0,
                             "the counts line was expected: the numbers of "
                             "atoms and bonds, three columns each");
    v.end_may_lack = scan->size < 39;
    if ((st = bs_scan__column(scan, 0, 3, 0, 999, "the number of atoms", &atoms)) != BS_OK ||
        (st = bs_scan__column(scan, 3, 3, 0, 999, "the number of bonds", &bonds)) != BS_OK ||
        (st = bs_scan__column(scan, 6, 3, 0, 999, "the number of atom lists", &lists)) != BS_OK ||
        (st = bs_scan__column(scan, 12, 3, 0, 999, "the chiral flag", &chiral)) != BS_OK ||
        (st = bs_scan__column(scan, 15, 3, 0, 999, "the number of text entries", &texts)) != BS_OK)
        return st;
    if (lists > 0)
        return bs_scan__fail(scan, BS_EVALUE, 6, 3,
                             "atom lists belong to a query; a molecule was "
                             "expected");
    if ((st = bs_molfile__reserve(file, (uint32_t)atoms, (uint32_t)bonds)) != BS_OK)
        return st;
    file->atom_count = (uint32_t)atoms;
    file->bond_count = (uint32_t)bonds;
    file->chiral = chiral == 1;
    if ((st = read_blocks(&v, 2 * texts)) != BS_OK)
        return st;
    return read_properties(&v);
}
