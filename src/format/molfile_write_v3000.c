/* The blocks of a V3000 molfile, written. */
#include "format/molfile_write.h"

#include <stdarg.h>
#include <stdio.h>
#include <string.h>

enum { LINE_MAX_BYTES = 79, PREFIX = 7 };

/* Writes a line behind "M  V30 "; a line that is too long goes on in the next. */
static bs_status put_line(bs_text *out, const char *line, size_t length)
{
    size_t at = 0;
    bs_status st;

    for (;;) {
        size_t room = LINE_MAX_BYTES - PREFIX;
        bool whole = length - at <= room;
        size_t size = whole ? length - at : room - 1;

        if ((st = bs_text_puts(out, "M  V30 ")) != BS_OK ||
            (st = bs_text_add(out, line + at, size)) != BS_OK ||
            (st = bs_text_puts(out, whole ? "\n" : "-\n")) != BS_OK || whole)
            return st;
        at += size;
    }
}

static bs_status put(bs_text *out, const char *format, ...) __attribute__((format(printf, 2, 3)));

static bs_status put(bs_text *out, const char *format, ...)
{
    char line[256];
    va_list args;

    va_start(args, format);
    vsnprintf(line, sizeof line, format, args);
    va_end(args);
    return put_line(out, line, strlen(line));
}

/* The options behind an atom, each with a blank before. */
static void list_options(const bs_molfile_out *o, uint32_t i, char *text, size_t size)
{
    const bs_atom *a = &o->mol->atoms[i];
    int valence = bs_molfile__out_valence(o, i);
    int radical = bs_molfile__out_radical(o, i);
    size_t used = 0;

    text[0] = '\0';
    if (a->charge != 0)
        used += (size_t)snprintf(text + used, size - used, " CHG=%d", a->charge);
    if (radical != 0)
        used += (size_t)snprintf(text + used, size - used, " RAD=%d", radical);
    if (a->isotope != 0)
        used += (size_t)snprintf(text + used, size - used, " MASS=%d", a->isotope);
    if (valence >= 0)
        used += (size_t)snprintf(text + used, size - used, " VAL=%d", valence == 0 ? -1 : valence);
    if (a->element == 0 && a->label != 0)
        snprintf(text + used, size - used, " RGROUPS=(1 %d)", a->label);
}

static bs_status write_atom(const bs_molfile_out *o, uint32_t i)
{
    bs_point at = bs_molfile__out_place(o, i);
    char options[128] = "";
    const char *symbol = "H";
    int label = 0;

    if (i < o->mol->atom_count) {
        const bs_atom *a = &o->mol->atoms[i];
        bool is_group = a->element == 0 && a->label > 0;

        symbol = is_group ? "R#" : bs_element_symbol(a->element);
        label = is_group ? 0 : a->label;
        list_options(o, i, options, sizeof options);
    }
    return put(o->out, "%u %s %.4f %.4f 0 %d%s", (unsigned)i + 1, symbol, at.x, at.y, label,
               options);
}

static bs_status write_bond(const bs_molfile_out *o, uint32_t i)
{
    bs_molfile_out_bond b = bs_molfile__out_bond(o, i);
    int stereo = b.undecided ? 2 : b.wedge == BS_WEDGE_UP ? 1 : b.wedge == BS_WEDGE_DOWN ? 3 : 0;
    char option[16] = "";

    if (stereo != 0)
        snprintf(option, sizeof option, " CFG=%d", stereo);
    return put(o->out, "%u %d %u %u%s", (unsigned)i + 1, b.order == 0 ? 9 : b.order,
               (unsigned)b.a + 1, (unsigned)b.b + 1, option);
}

static bs_status write_bonds(const bs_molfile_out *o)
{
    bs_status st = o->bond_count > 0 ? put(o->out, "BEGIN BOND") : BS_OK;

    for (uint32_t i = 0; i < o->bond_count && st == BS_OK; i++)
        st = write_bond(o, i);
    return st == BS_OK && o->bond_count > 0 ? put(o->out, "END BOND") : st;
}

static bs_status write_group(const bs_molfile_out *o, const bs_stereo_group *group)
{
    bs_text line;
    bs_status st;

    bs_text_init(&line, o->out->cx);
    if (group->kind == BS_STEREO_GROUP_ABSOLUTE)
        st = bs_text_puts(&line, "MDLV30/STEABS");
    else
        st = bs_text_printf(&line, "MDLV30/STE%s%d",
                            group->kind == BS_STEREO_GROUP_RELATIVE ? "REL" : "RAC", group->number);
    if (st == BS_OK)
        st = bs_text_printf(&line, " ATOMS=(%d", group->atom_count);
    for (int i = 0; i < group->atom_count && st == BS_OK; i++)
        st = bs_text_printf(&line, " %d", group->atoms[i] + 1);
    if (st == BS_OK && (st = bs_text_putc(&line, ')')) == BS_OK)
        st = put_line(o->out, line.data, line.length);
    bs_text_free(&line);
    return st;
}

static bs_status write_groups(const bs_molfile_out *o)
{
    bs_status st = o->group_count > 0 ? put(o->out, "BEGIN COLLECTION") : BS_OK;

    for (int i = 0; i < o->group_count && st == BS_OK; i++)
        st = write_group(o, &o->groups[i]);
    return st == BS_OK && o->group_count > 0 ? put(o->out, "END COLLECTION") : st;
}

bs_status bs_molfile__write_v3000(const bs_molfile_out *o)
{
    bs_status st = bs_text_puts(o->out, "  0  0  0     0  0            999 V3000\n");

    if (st == BS_OK)
        st = put(o->out, "BEGIN CTAB");
    if (st == BS_OK)
        st = put(o->out, "COUNTS %u %u 0 0 %d", (unsigned)o->atom_count, (unsigned)o->bond_count,
                 o->chiral);
    if (st == BS_OK)
        st = put(o->out, "BEGIN ATOM");
    for (uint32_t i = 0; i < o->atom_count && st == BS_OK; i++)
        st = write_atom(o, i);
    if (st == BS_OK)
        st = put(o->out, "END ATOM");
    if (st == BS_OK)
        st = write_bonds(o);
    if (st == BS_OK)
        st = write_groups(o);
    return st == BS_OK ? put(o->out, "END CTAB") : st;
}
