/*
 * The blocks of a V3000 molfile: lines of words behind "M  V30 ", which go on in the next line
 * after a hyphen.
 */
#include "core/map.h"
#include "format/molfile.h"

#include <math.h>
#include <string.h>

typedef struct v3000 {
    bs_molfile *file;
    bs_scan *scan;
    bs_text joined;   /* a line that went on */
    bs_map index;     /* from the numbers that the file gives to atoms to their places */
    const char *text; /* the line in hand behind "M  V30 " */
    size_t length;
    size_t at;
    long line;     /* where it begins */
    size_t column; /* of its first byte, SIZE_MAX if it was joined */
} v3000;

/* A word of a line: a name, a number, name=value, a list in parentheses or a quoted text. */
typedef struct word {
    const char *text;
    size_t length;
} word;

/* ---- Lines and words ----------------------------------------------------------------------- */

static bs_status fail_word(const v3000 *v, bs_status code, word w, const char *expected)
{
    int shown = w.length > 40 ? 40 : (int)w.length;

    if (v->column != SIZE_MAX && w.length > 0)
        return bs_scan__fail(v->scan, code, v->column + (size_t)(w.text - v->text), w.length,
                             "'%.*s' stands where %s was expected", shown, w.text, expected);
    if (w.length > 0)
        return bs_scan__fail_line(v->file->cx, v->line, code, "'%.*s' stands where %s was expected",
                                  shown, w.text, expected);
    return bs_scan__fail_line(v->file->cx, v->line, code, "the line ends where %s was expected",
                              expected);
}

static bs_status need_v30(v3000 *v)
{
    bs_status st = bs_scan__need_line(v->scan, "a line that starts with 'M  V30'");

    if (st != BS_OK || bs_scan__starts(v->scan, "M  V30 "))
        return st;
    return bs_scan__fail(v->scan, BS_ESYNTAX, 0, 0,
                         "a line that starts with 'M  V30 ' was expected");
}

/* Gathers a line that goes on in the next ones. */
static bs_status join(v3000 *v)
{
    bs_status st;

    bs_text_clear(&v->joined);
    v->column = SIZE_MAX;
    for (;;) {
        bool more = v->scan->size > 7 && v->scan->at[v->scan->size - 1] == '-';
        size_t length = v->scan->size - 7 - (more ? 1 : 0);

        if ((st = bs_text_add(&v->joined, v->scan->at + 7, length)) != BS_OK)
            return st;
        if (!more)
            break;
        if ((st = bs_poll(v->file->cx)) != BS_OK || (st = need_v30(v)) != BS_OK)
            return st;
    }
    v->text = v->joined.data;
    v->length = v->joined.length;
    return BS_OK;
}

/* The next line of words. */
static bs_status next_line(v3000 *v)
{
    bs_status st = need_v30(v);

    if (st != BS_OK)
        return st;
    v->line = v->scan->line;
    v->at = 0;
    if (v->scan->size > 7 && v->scan->at[v->scan->size - 1] == '-')
        return join(v);
    v->column = 7;
    v->text = v->scan->at + 7;
    v->length = v->scan->size - 7;
    return BS_OK;
}

/* The next word, empty at the end. Blanks within quotes and parentheses are part of it. */
static word next_word(v3000 *v)
{
    bool quoted = false;
    int depth = 0;
    word w;

    while (v->at < v->length && v->text[v->at] == ' ')
        v->at++;
    w.text = v->text + v->at;
    for (; v->at < v->length; v->at++) {
        char c = v->text[v->at];

        if (c == '"')
            quoted = !quoted;
        else if (!quoted && c == '(')
            depth++;
        else if (!quoted && c == ')' && depth > 0)
            depth--;
        else if (c == ' ' && !quoted && depth == 0)
            break;
    }
    w.length = (size_t)(v->text + v->at - w.text);
    return w;
}

static bool is_word(word w, const char *text)
{
    return w.length == strlen(text) && memcmp(w.text, text, w.length) == 0;
}

/* Whether a word is `name`=value; cuts the value out. */
static bool is_option(word w, const char *name, word *value)
{
    size_t length = strlen(name);

    if (w.length <= length || memcmp(w.text, name, length) != 0 || w.text[length] != '=')
        return false;
    *value = (word){w.text + length + 1, w.length - length - 1};
    return true;
}

static bs_status need_long(v3000 *v, word w, long low, long high, const char *expected, long *out)
{
    return bs_scan__long(w.text, w.length, low, high, out) ? BS_OK
                                                           : fail_word(v, BS_ESYNTAX, w, expected);
}

static bs_status need_words(v3000 *v, const char *first, const char *second)
{
    word w = next_word(v);

    if (!is_word(w, first))
        return fail_word(v, BS_ESYNTAX, w, first);
    w = next_word(v);
    return is_word(w, second) ? BS_OK : fail_word(v, BS_ESYNTAX, w, second);
}

/* Whether the line in hand is "END `block`"; it is left at its start if not. */
static bool at_end_of(v3000 *v, const char *block)
{
    word w = next_word(v);

    if (is_word(w, "END") && is_word(next_word(v), block))
        return true;
    v->at = 0;
    return false;
}

/* ---- Atoms --------------------------------------------------------------------------------- */

/* The place of the atom that the file calls `number`. */
static bs_status find_atom(v3000 *v, word w, uint32_t *place)
{
    size_t cursor = 0;
    long number;
    bs_status st = need_long(v, w, 1, INT32_MAX, "an atom number", &number);

    if (st != BS_OK)
        return st;
    *place = bs_map_next(&v->index, (uint64_t)number, &cursor);
    return *place != BS_MAP_NONE ? BS_OK : fail_word(v, BS_EVALUE, w, "the number of an atom");
}

/* RGROUPS=(1 n) */
static bs_status read_groups(v3000 *v, word value, bs_molfile_atom *atom)
{
    long count = 0;
    long number = 0;
    size_t at = 1;

    while (at < value.length && value.text[at] != ' ')
        at++;
    if (value.length < 5 || value.text[0] != '(' || value.text[value.length - 1] != ')' ||
        !bs_scan__long(value.text + 1, at - 1, 1, 999, &count) || count != 1 ||
        at + 2 > value.length ||
        !bs_scan__long(value.text + at + 1, value.length - at - 2, 0, UINT16_MAX, &number))
        return fail_word(v, BS_EVALUE, value, "one R group, such as (1 2),");
    atom->label = (uint16_t)number;
    return BS_OK;
}

static bs_status read_atom_option(v3000 *v, word w, bs_molfile_atom *atom)
{
    word value;
    long n = 0;
    bs_status st;

    if (is_option(w, "CHG", &value)) {
        st = need_long(v, value, -15, 15, "a charge (-15 to 15)", &n);
        atom->charge = (int8_t)n;
    } else if (is_option(w, "MASS", &value)) {
        st = need_long(v, value, 0, 999, "a mass number", &n);
        atom->isotope = (uint16_t)n;
    } else if (is_option(w, "RAD", &value)) {
        st = need_long(v, value, 0, 3, "a radical code (0 to 3)", &n);
        atom->radical = (uint8_t)n;
    } else if (is_option(w, "VAL", &value)) {
        st = need_long(v, value, -1, 14, "a valence (-1 to 14; -1 is none)", &n);
        atom->valence = (int16_t)(n == 0 ? -1 : n == -1 ? 0 : n);
    } else if (is_option(w, "HCOUNT", &value)) {
        st = need_long(v, value, -1, 99, "a hydrogen count", &n);
        atom->hydrogens = (int16_t)(n == 0 ? -1 : n == -1 ? 0 : n);
    } else if (is_option(w, "CFG", &value)) {
        st = need_long(v, value, 0, 3, "a parity (0 to 3)", &n);
        atom->parity = (uint8_t)(n < 3 ? n : 0);
    } else if (is_option(w, "RGROUPS", &value)) {
        st = read_groups(v, value, atom);
    } else {
        st = BS_OK; /* drawing, queries on environments, templates */
    }
    return st;
}

static bs_status read_symbol(v3000 *v, bs_molfile_atom *atom)
{
    word w = next_word(v);

    if (w.length >= 2 && w.text[0] == '"' && w.text[w.length - 1] == '"')
        w = (word){w.text + 1, w.length - 2};
    if (bs_molfile__symbol(w.text, w.length, atom))
        return BS_OK;
    if (w.length > 0 && (w.text[0] == '[' || is_word(w, "NOT")))
        return bs_scan__fail_line(v->file->cx, v->line, BS_EVALUE,
                                  "a list of elements; a molecule "
                                  "has one element at each place");
    return bs_scan__fail_line(v->file->cx, v->line, BS_EVALUE, "'%.*s' is %s",
                              w.length > 40 ? 40 : (int)w.length, w.text,
                              bs_molfile__symbol_trouble(w.text, w.length));
}

static bs_status read_place(v3000 *v, double *out)
{
    word w = next_word(v);

    if (bs_scan__double(w.text, w.length, out) && fabs(*out) <= BS_MOLFILE_PLACE_MAX)
        return BS_OK;
    return fail_word(v, BS_ESYNTAX, w, "a coordinate such as 1.25");
}

static bs_status read_atom(v3000 *v, uint32_t place)
{
    bs_molfile_atom *atom = &v->file->atoms[place];
    size_t cursor = 0;
    long number;
    long mapping;
    word w = next_word(v);
    bs_status st;

    *atom = (bs_molfile_atom){.valence = -1, .hydrogens = -1, .line = v->line};
    if ((st = need_long(v, w, 1, INT32_MAX, "an atom number", &number)) != BS_OK)
        return st;
    if (bs_map_next(&v->index, (uint64_t)number, &cursor) != BS_MAP_NONE)
        return fail_word(v, BS_EVALUE, w, "an atom number of its own");
    if ((st = bs_map_add(&v->index, (uint64_t)number, place)) != BS_OK ||
        (st = read_symbol(v, atom)) != BS_OK || (st = read_place(v, &atom->x)) != BS_OK ||
        (st = read_place(v, &atom->y)) != BS_OK || (st = read_place(v, &atom->z)) != BS_OK ||
        (st = need_long(v, next_word(v), 0, UINT16_MAX, "an atom mapping number (0 for none)",
                        &mapping)) != BS_OK)
        return st;
    if (mapping > 0)
        atom->label = (uint16_t)mapping;
    for (w = next_word(v); w.length > 0 && st == BS_OK; w = next_word(v))
        st = read_atom_option(v, w, atom);
    return st;
}

/* ---- Bonds --------------------------------------------------------------------------------- */

static bs_status read_bond(v3000 *v, bs_molfile_bond *bond)
{
    static const uint8_t marks[] = {BS_MARK_NONE, BS_MARK_UP, BS_MARK_EITHER, BS_MARK_DOWN};
    long number;
    long type;
    long mark = 0;
    word w;
    word value;
    bs_status st;

    *bond = (bs_molfile_bond){.line = v->line};
    if ((st = need_long(v, next_word(v), 0, INT32_MAX, "a bond number", &number)) != BS_OK ||
        (st = need_long(v, next_word(v), 0, 99, "a bond type", &type)) != BS_OK ||
        (st = bs_molfile__check_type(v->scan, 0, 0, type)) != BS_OK ||
        (st = find_atom(v, next_word(v), &bond->a)) != BS_OK ||
        (st = find_atom(v, next_word(v), &bond->b)) != BS_OK)
        return st;
    if (bond->a == bond->b)
        return bs_scan__fail_line(v->file->cx, v->line, BS_EVALUE, "an atom is bonded to itself");
    for (w = next_word(v); w.length > 0; w = next_word(v)) {
        if (is_option(w, "ENDPTS", &value))
            return fail_word(v, BS_EVALUE, w, "a bond between two atoms");
        if (is_option(w, "CFG", &value) &&
            (st = need_long(v, value, 0, 3, "a bond stereo code (0 to 3)", &mark)) != BS_OK)
            return st;
    }
    bond->type = (uint8_t)type;
    bond->mark = marks[mark];
    return BS_OK;
}

/* ---- Stereo groups ------------------------------------------------------------------------- */

/* The kind and number that a name such as MDLV30/STERAC1 tells; false for other collections. */
static bool group_of_name(word w, bs_molfile_group *group)
{
    long number = 0;

    if (is_word(w, "MDLV30/STEABS")) {
        group->kind = BS_STEREO_GROUP_ABSOLUTE;
        return true;
    }
    if (w.length < 14 || !bs_scan__long(w.text + 13, w.length - 13, 1, 9999, &number))
        return false;
    group->number = (int)number;
    group->kind = BS_STEREO_GROUP_RELATIVE;
    if (memcmp(w.text, "MDLV30/STEREL", 13) == 0)
        return true;
    group->kind = BS_STEREO_GROUP_RACEMIC;
    return memcmp(w.text, "MDLV30/STERAC", 13) == 0;
}

/* ATOMS=(n a b c) */
static bs_status read_members(v3000 *v, word value, bs_molfile_group *group)
{
    v3000 inner = *v;
    long count;
    bs_status st;

    if (value.length < 3 || value.text[0] != '(' || value.text[value.length - 1] != ')')
        return fail_word(v, BS_ESYNTAX, value, "a list of atoms such as (2 1 4)");
    inner.text = value.text + 1;
    inner.length = value.length - 2;
    inner.at = 0;
    if (v->column != SIZE_MAX)
        inner.column = v->column + (size_t)(inner.text - v->text);
    if ((st = need_long(&inner, next_word(&inner), 0, v->file->atom_count, "the number of atoms",
                        &count)) != BS_OK ||
        (st = bs_new(v->file->cx, v->file->temp, count, &group->atoms)) != BS_OK)
        return st;
    for (long i = 0; i < count && st == BS_OK; i++)
        st = find_atom(&inner, next_word(&inner), &group->atoms[i]);
    group->count = (uint32_t)count;
    return st;
}

static bs_status add_group(bs_molfile *file, bs_molfile_group group)
{
    bs_molfile_group *old = file->groups;
    uint32_t room = file->group_room ? 2 * file->group_room : 8;
    bs_status st;

    if (file->group_count == file->group_room) {
        if ((st = bs_new(file->cx, file->temp, room, &file->groups)) != BS_OK)
            return st;
        if (old)
            memcpy(file->groups, old, file->group_count * sizeof *old);
        file->group_room = room;
    }
    file->groups[file->group_count++] = group;
    return BS_OK;
}

static bs_status read_collection(v3000 *v)
{
    bs_status st;

    for (;;) {
        bs_molfile_group group = {0};
        word w;
        word value;

        if ((st = next_line(v)) != BS_OK || at_end_of(v, "COLLECTION"))
            return st;
        if (!group_of_name(next_word(v), &group))
            continue;
        for (w = next_word(v); w.length > 0 && st == BS_OK; w = next_word(v)) {
            if (is_option(w, "ATOMS", &value))
                st = read_members(v, value, &group);
        }
        if (st != BS_OK || (st = add_group(v->file, group)) != BS_OK)
            return st;
    }
}

/* ---- All together -------------------------------------------------------------------------- */

static bs_status read_counts(v3000 *v)
{
    long atoms;
    long bonds;
    long skipped;
    long chiral;
    word w;
    bs_status st;

    if ((st = next_line(v)) != BS_OK)
        return st;
    w = next_word(v);
    if (!is_word(w, "COUNTS"))
        return fail_word(v, BS_ESYNTAX, w, "COUNTS");
    if ((st = need_long(v, next_word(v), 0, BS_MOL_MAX_ATOMS, "the number of atoms", &atoms)) !=
            BS_OK ||
        (st = need_long(v, next_word(v), 0, BS_MOL_MAX_ATOMS, "the number of bonds", &bonds)) !=
            BS_OK ||
        (st = need_long(v, next_word(v), 0, INT32_MAX, "the number of S groups", &skipped)) !=
            BS_OK ||
        (st = need_long(v, next_word(v), 0, INT32_MAX, "the number of 3D features", &skipped)) !=
            BS_OK ||
        (st = need_long(v, next_word(v), 0, 1, "the chiral flag", &chiral)) != BS_OK)
        return st;
    /* A line for each atom has to follow: a count that the text cannot hold takes no memory. */
    if ((size_t)(atoms + bonds) > v->scan->length / 8)
        return bs_scan__fail_line(v->file->cx, v->line, BS_ESYNTAX,
                                  "%ld atoms and %ld bonds are "
                                  "announced; the record is too short for them",
                                  atoms, bonds);
    v->file->atom_count = (uint32_t)atoms;
    v->file->bond_count = (uint32_t)bonds;
    v->file->chiral = chiral == 1;
    return bs_molfile__reserve(v->file, (uint32_t)atoms, (uint32_t)bonds);
}

static bs_status read_atoms(v3000 *v)
{
    bs_status st;

    if ((st = next_line(v)) != BS_OK || (st = need_words(v, "BEGIN", "ATOM")) != BS_OK)
        return st;
    for (uint32_t i = 0; i < v->file->atom_count && st == BS_OK; i++) {
        if ((st = next_line(v)) == BS_OK)
            st = read_atom(v, i);
    }
    if (st != BS_OK || (st = next_line(v)) != BS_OK)
        return st;
    return need_words(v, "END", "ATOM");
}

static bs_status read_bonds(v3000 *v)
{
    bs_status st = BS_OK;

    for (uint32_t i = 0; i < v->file->bond_count && st == BS_OK; i++) {
        if ((st = next_line(v)) == BS_OK)
            st = read_bond(v, &v->file->bonds[i]);
    }
    if (st != BS_OK || (st = next_line(v)) != BS_OK)
        return st;
    return need_words(v, "END", "BOND");
}

/* Goes behind the end of a block that is of no interest. */
static bs_status skip_block(v3000 *v, word name)
{
    bs_status st;

    for (;;) {
        word w;
        word ended;

        if ((st = next_line(v)) != BS_OK)
            return st;
        w = next_word(v);
        ended = next_word(v);
        if (is_word(w, "END") && ended.length == name.length &&
            memcmp(ended.text, name.text, name.length) == 0)
            return BS_OK;
    }
}

/* The blocks behind the atoms, up to the end of the table. */
static bs_status read_blocks(v3000 *v)
{
    bool bonds = false;
    bs_status st;

    for (;;) {
        char kept[32];
        word w;

        if ((st = next_line(v)) != BS_OK)
            return st;
        if (at_end_of(v, "CTAB"))
            break;
        w = next_word(v);
        if (is_word(w, "LINKNODE"))
            return fail_word(v, BS_EVALUE, w, "a plain molecule");
        if (!is_word(w, "BEGIN"))
            return fail_word(v, BS_ESYNTAX, w, "BEGIN or END CTAB");
        w = next_word(v);
        if (w.length == 0 || w.length > sizeof kept)
            return fail_word(v, BS_ESYNTAX, w, "the name of a block");
        memcpy(kept, w.text, w.length);
        if (is_word(w, "BOND")) {
            bonds = true;
            st = read_bonds(v);
        } else if (is_word(w, "COLLECTION")) {
            st = read_collection(v);
        } else {
            st = skip_block(v, (word){kept, w.length});
        }
        if (st != BS_OK)
            return st;
    }
    if (!bonds && v->file->bond_count > 0)
        return bs_scan__fail_line(v->file->cx, v->line, BS_ESYNTAX,
                                  "the table ends without its bonds");
    return BS_OK;
}

static bs_status read_table(v3000 *v)
{
    bs_status st;

    if ((st = next_line(v)) != BS_OK || (st = need_words(v, "BEGIN", "CTAB")) != BS_OK ||
        (st = read_counts(v)) != BS_OK || (st = read_atoms(v)) != BS_OK ||
        (st = read_blocks(v)) != BS_OK || (st = bs_scan__need_line(v->scan, "M  END")) != BS_OK)
        return st;
    if (bs_scan__starts(v->scan, "M  END"))
        return BS_OK;
    if (bs_scan__starts(v->scan, "M  V30 BEGIN RGROUP"))
        return bs_scan__fail(v->scan, BS_EVALUE, 7, 12,
                             "a definition of R groups belongs to a "
                             "query; a molecule was expected");
    return bs_scan__fail(v->scan, BS_ESYNTAX, 0, 0, "M  END was expected");
}

bs_status bs_molfile__read_v3000(bs_molfile *file, bs_scan *scan)
{
    v3000 v = {.file = file, .scan = scan};
    bs_status st;

    bs_text_init(&v.joined, file->cx);
    bs_map_init(&v.index, file->cx);
    st = read_table(&v);
    bs_map_free(&v.index);
    bs_text_free(&v.joined);
    return st;
}
