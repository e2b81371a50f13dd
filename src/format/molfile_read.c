/*
 * Reading molfiles: the header, the counts line, and what both versions share.
 *
 * After "CTfile Formats" (the public description of the formats; from memory).
 */
#include "format/molfile.h"

#include <string.h>

/* ---- What both versions share -------------------------------------------------------------- */

static bool is_text(const char *text, size_t length, const char *wanted)
{
    return length == strlen(wanted) && memcmp(text, wanted, length) == 0;
}

bool bs_molfile__symbol(const char *text, size_t length, bs_molfile_atom *atom)
{
    long number = 0;
    int element;

    if (is_text(text, length, "D") || is_text(text, length, "T")) {
        atom->element = 1;
        atom->isotope = text[0] == 'D' ? 2 : 3;
        return true;
    }
    if (is_text(text, length, "*") || is_text(text, length, "A")) {
        atom->element = 0;
        return true;
    }
    if (length >= 1 && text[0] == 'R' &&
        (length == 1 || is_text(text, length, "R#") ||
         bs_scan__long(text + 1, length - 1, 0, UINT16_MAX, &number))) {
        atom->element = 0;
        atom->label = (uint16_t)number;
        atom->is_group = length == 2 && text[1] == '#';
        return true;
    }
    /* Some programs write the halogens in capitals. */
    if (is_text(text, length, "CL") || is_text(text, length, "BR")) {
        atom->element = text[0] == 'C' ? 17 : 35;
        return true;
    }
    element = bs_element_number(text, length);
    if (element < 1)
        return false;
    atom->element = (uint8_t)element;
    return true;
}

const char *bs_molfile__symbol_trouble(const char *text, size_t length)
{
    if (is_text(text, length, "L"))
        return "a list of elements; a molecule has one element at each place";
    if (is_text(text, length, "LP"))
        return "a lone pair; atoms were expected";
    if (is_text(text, length, "Q") || is_text(text, length, "X") || is_text(text, length, "M") ||
        is_text(text, length, "AH") || is_text(text, length, "QH") || is_text(text, length, "XH") ||
        is_text(text, length, "MH"))
        return "a query atom; a molecule has one element at each place";
    return "no element; a symbol such as C or Cl was expected";
}

bs_status bs_molfile__check_type(const bs_scan *scan, size_t column, size_t width, long type)
{
    if ((type >= 1 && type <= 4) || type == BS_MOLFILE_BOND_COORDINATE ||
        type == BS_MOLFILE_BOND_HYDROGEN)
        return BS_OK;
    if (type >= 5 && type <= 8)
        return bs_scan__fail(scan, BS_EVALUE, column, width,
                             "bond type %ld belongs to a query; a "
                             "molecule has types 1 to 4",
                             type);
    return bs_scan__fail(scan, BS_EVALUE, column, width,
                         "there is no bond type %ld; 1 to 4 were "
                         "expected (4 is aromatic)",
                         type);
}

bs_status bs_molfile__reserve(bs_molfile *file, uint32_t atoms, uint32_t bonds)
{
    bs_status st;

    if ((st = bs_new(file->cx, file->temp, atoms, &file->atoms)) != BS_OK)
        return st;
    return bs_new(file->cx, file->temp, bonds, &file->bonds);
}

/* ---- Header -------------------------------------------------------------------------------- */

static void take_name(bs_molfile *file, const bs_scan *scan)
{
    size_t start = 0;
    size_t end = scan->size;

    while (start < end && (scan->at[start] == ' ' || scan->at[start] == '\t'))
        start++;
    while (end > start && (scan->at[end - 1] == ' ' || scan->at[end - 1] == '\t'))
        end--;
    file->name = scan->at + start;
    file->name_length = end - start;
}

/* Other files of the family start with a word of their own. */
static bs_status check_first_line(const bs_scan *scan)
{
    if (bs_scan__starts(scan, "$RXN"))
        return bs_scan__fail(scan, BS_EVALUE, 0, 4, "this is a reaction; a molecule was expected");
    if (bs_scan__starts(scan, "$MDL"))
        return bs_scan__fail(scan, BS_EVALUE, 0, 4,
                             "this is a query with R groups; a molecule was "
                             "expected");
    if (bs_scan__starts(scan, "$RDFILE"))
        return bs_scan__fail(scan, BS_EVALUE, 0, 7,
                             "this is an RD file; a molfile or SD file was "
                             "expected");
    return BS_OK;
}

/* The version that a counts line states: 2 or 3; files from before there were versions have 2. */
static bs_status read_version(const bs_scan *scan, int *version)
{
    *version = 2;
    for (size_t i = 0; i + 5 <= scan->size; i++) {
        if (memcmp(scan->at + i, "V3000", 5) == 0)
            *version = 3;
        if (scan->at[i] != 'V')
            continue;
        if (*version == 3 || memcmp(scan->at + i, "V2000", 5) == 0)
            return BS_OK;
        return bs_scan__fail(scan, BS_ESYNTAX, i, 5,
                             "'%.5s' is no version of the molfile format; "
                             "V2000 or V3000 was expected",
                             scan->at + i);
    }
    return BS_OK;
}

bs_status bs_molfile__read(bs_molfile *file, bs_scan *scan)
{
    int version;
    bs_status st;

    if ((st = bs_scan__need_line(scan, "the name of a molecule")) != BS_OK ||
        (st = check_first_line(scan)) != BS_OK)
        return st;
    take_name(file, scan);
    if ((st = bs_scan__need_line(scan, "the second line of the header")) != BS_OK ||
        (st = bs_scan__need_line(scan, "the third line of the header")) != BS_OK ||
        (st = bs_scan__need_line(scan, "the counts line")) != BS_OK ||
        (st = read_version(scan, &version)) != BS_OK)
        return st;
    if (version == 3)
        return bs_molfile__read_v3000(file, scan);
    return bs_molfile__read_v2000(file, scan);
}

bs_status bs_molfile_read(bs_ctx *cx, bs_arena *home, const char *text, size_t length,
                          bs_record **out)
{
    bs_mark kept = bs_arena_mark(home);
    bs_mark temp = bs_arena_mark(&cx->scratch);
    bs_molfile file = {.cx = cx, .temp = &cx->scratch};
    bs_record *record;
    bs_scan scan;
    bs_status st;

    *out = NULL;
    bs_scan__begin(&scan, cx, text, length, 1);
    if ((st = bs_new(cx, home, 1, &record)) == BS_OK &&
        (st = bs_molfile__read(&file, &scan)) == BS_OK)
        st = bs_molfile__build(&file, home, record);
    if (home != &cx->scratch)
        bs_arena_rewind(&cx->scratch, temp);
    if (st != BS_OK) {
        bs_arena_rewind(home, kept);
        return st;
    }
    record->number = 1;
    record->line = 1;
    *out = record;
    return BS_OK;
}
