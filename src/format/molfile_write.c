/* Writing molfiles: what can be written, the header, and what both versions share. */
#include "format/molfile_write.h"

#include "chem/valence.h"

#include <string.h>

enum { V2000_MOST = 999, MOST_CHARGE = 15, MOST_MASS = 999, MOST_VALENCE = 14 };

/* ---- Atoms and bonds ----------------------------------------------------------------------- */

bs_molfile_out_bond bs_molfile__out_bond(const bs_molfile_out *o, uint32_t i)
{
    bs_molfile_out_bond out = {.order = 1};
    const bs_bond *bond;

    if (i >= o->mol->bond_count) {
        const bs_layout_hydrogen *h = &o->layout->hydrogens[i - o->mol->bond_count];

        out.a = (uint32_t)h->atom;
        out.b = o->mol->atom_count + i - o->mol->bond_count;
        out.wedge = h->wedge;
        return out;
    }
    bond = bs_mol__bonds(o->mol) + i;
    out.a = o->layout->bonds[i].from_b ? bond->b : bond->a;
    out.b = o->layout->bonds[i].from_b ? bond->a : bond->b;
    out.order = (int)bond->order;
    out.wedge = (bs_wedge)o->layout->bonds[i].wedge;
    out.undecided = o->layout->bonds[i].undecided;
    return out;
}

bs_point bs_molfile__out_place(const bs_molfile_out *o, uint32_t i)
{
    bs_point at = i < o->mol->atom_count ? o->layout->atoms[i]
                                         : o->layout->hydrogens[i - o->mol->atom_count].at;

    at.x *= BS_MOLFILE_SCALE;
    at.y *= BS_MOLFILE_SCALE;
    /* No "-0.0000". */
    if (at.x > -0.00005 && at.x < 0)
        at.x = 0;
    if (at.y > -0.00005 && at.y < 0)
        at.y = 0;
    return at;
}

static bool is_normal(const bs_atom *a)
{
    const uint8_t *v = bs_valence__normal(a->element, a->charge);

    while (*v != 0 && *v != a->valence)
        v++;
    return *v != 0;
}

int bs_molfile__out_valence(const bs_molfile_out *o, uint32_t atom)
{
    const bs_atom *a = &o->mol->atoms[atom];
    int bonds = a->valence - a->hydrogens + o->drawn[atom];

    if ((a->element == 0 && a->hydrogens == 0) || a->valence > MOST_VALENCE)
        return -1;
    /* Bare ions need none. Of other unusual atoms, and of metals, readers have their own ideas. */
    if (a->charge != 0 && a->valence == 0)
        return bs_valence__implied(a->element, a->charge, 0) == 0 ? -1 : 0;
    if (is_normal(a) && bs_valence__implied(a->element, a->charge, bonds) + bonds == a->valence)
        return -1;
    return a->valence;
}

int bs_molfile__out_radical(const bs_molfile_out *o, uint32_t atom)
{
    const bs_atom *a = &o->mol->atoms[atom];

    return bs_valence__implied(a->element, a->charge, a->valence) == 1 ? 2 : 0;
}

/* ---- What can be written ------------------------------------------------------------------- */

static bs_status check_atoms(bs_ctx *cx, const bs_mol *mol)
{
    for (uint32_t i = 0; i < mol->atom_count; i++) {
        const bs_atom *a = &mol->atoms[i];

        if (a->charge > MOST_CHARGE || a->charge < -MOST_CHARGE)
            return bs_fail(cx, BS_EVALUE, "atom %u: a molfile holds charges from -%d to %d, not %d",
                           (unsigned)i + 1, MOST_CHARGE, MOST_CHARGE, a->charge);
        if (a->isotope > MOST_MASS)
            return bs_fail(cx, BS_EVALUE, "atom %u: a molfile holds mass numbers up to %d, not %d",
                           (unsigned)i + 1, MOST_MASS, a->isotope);
    }
    for (uint32_t i = 0; i < mol->bond_count; i++) {
        const bs_bond *b = bs_mol__bonds(mol) + i;

        if (b->order > 3)
            return bs_fail(cx, BS_EVALUE,
                           "a molfile has no code for the quadruple bond between "
                           "atoms %u and %u",
                           (unsigned)b->a + 1, (unsigned)b->b + 1);
    }
    return BS_OK;
}

/* Why V2000 cannot hold the molecule, or NULL. */
static const char *v2000_trouble(const bs_molfile_out *o)
{
    if (o->atom_count > V2000_MOST)
        return "more than 999 atoms";
    if (o->bond_count > V2000_MOST)
        return "more than 999 bonds";
    for (uint32_t i = 0; i < o->mol->atom_count; i++) {
        if (o->mol->atoms[i].label > V2000_MOST)
            return "a label above 999";
    }
    for (uint32_t i = 0; i < o->mol->bond_count; i++) {
        if (bs_mol__bonds(o->mol)[i].order == 0)
            return "coordinate bonds";
    }
    for (int i = 0; i < o->group_count; i++) {
        if (o->groups[i].kind != BS_STEREO_GROUP_ABSOLUTE)
            return "relative and racemic centres";
    }
    return NULL;
}

static bs_status choose_version(bs_ctx *cx, const bs_molfile_out *o, bs_molfile_version *version)
{
    const char *trouble = *version == BS_MOLFILE_V3000 ? NULL : v2000_trouble(o);

    if (*version == BS_MOLFILE_AUTO)
        *version = trouble ? BS_MOLFILE_V3000 : BS_MOLFILE_V2000;
    else if (trouble)
        return bs_fail(cx, BS_EVALUE, "V2000 cannot hold %s; V3000 can", trouble);
    return BS_OK;
}

/* ---- The whole ----------------------------------------------------------------------------- */

/* The name on one line that no reader takes for something else. */
static bs_status write_name(bs_text *out, const char *name, size_t length)
{
    bs_status st = BS_OK;

    if (length > 0 && (name[0] == '$' || name[0] == '>'))
        st = bs_text_putc(out, ' ');
    for (size_t i = 0; i < length && st == BS_OK; i++)
        st = bs_text_putc(out, (unsigned char)name[i] < 32 || name[i] == 127 ? ' ' : name[i]);
    return st == BS_OK ? bs_text_putc(out, '\n') : st;
}

static bs_status prepare(bs_ctx *cx, bs_molfile_out *o, const bs_mol *mol)
{
    bs_layout *layout;
    bs_status st;

    if ((st = bs_layout_make(cx, &cx->scratch, mol, &layout)) != BS_OK ||
        (st = bs_new(cx, &cx->scratch, mol->atom_count, &o->drawn)) != BS_OK)
        return st;
    o->mol = mol;
    o->layout = layout;
    o->atom_count = mol->atom_count + (uint32_t)layout->hydrogen_count;
    o->bond_count = mol->bond_count + (uint32_t)layout->hydrogen_count;
    for (int i = 0; i < layout->hydrogen_count; i++)
        o->drawn[layout->hydrogens[i].atom]++;
    for (uint32_t i = 0; i < mol->atom_count; i++)
        o->chiral |= mol->atoms[i].stereo != BS_STEREO_NONE;
    return BS_OK;
}

static bs_status write(bs_text *out, const bs_record *record, bs_molfile_version version, int *lost)
{
    bs_ctx *cx = out->cx;
    bs_mark temp = bs_arena_mark(&cx->scratch);
    bs_molfile_out o = {.out = out, .groups = record->groups, .group_count = record->group_count};
    bs_status st;

    if ((st = check_atoms(cx, record->mol)) != BS_OK ||
        (st = prepare(cx, &o, record->mol)) != BS_OK ||
        (st = choose_version(cx, &o, &version)) != BS_OK ||
        (st = write_name(out, record->name, record->name ? record->name_length : 0)) != BS_OK ||
        (st = bs_text_puts(out, "  backsaw           2D\n\n")) != BS_OK)
        goto done;
    st = version == BS_MOLFILE_V3000 ? bs_molfile__write_v3000(&o) : bs_molfile__write_v2000(&o);
    if (st == BS_OK)
        st = bs_text_puts(out, "M  END\n");
    if (st == BS_OK && lost)
        *lost = o.layout->lost;
done:
    bs_arena_rewind(&cx->scratch, temp);
    return st;
}

/* Takes back what was added to a text. */
static void shorten(bs_text *text, size_t length)
{
    text->length = length;
    if (text->data)
        text->data[length] = '\0';
}

bs_status bs_molfile_write(bs_text *out, const bs_mol *mol, const char *name,
                           bs_molfile_version version, int *lost)
{
    size_t length = out->length;
    bs_record record = {.mol = mol, .name = name, .name_length = name ? strlen(name) : 0};
    bs_status st = write(out, &record, version, lost);

    if (st != BS_OK)
        shorten(out, length);
    return st;
}

/* ---- SD records ---------------------------------------------------------------------------- */

static bs_status write_field_name(bs_text *out, const bs_field *field)
{
    bs_status st = bs_text_puts(out, ">  <");

    for (size_t i = 0; i < field->name_length && st == BS_OK; i++) {
        char c = field->name[i];

        st = bs_text_putc(out, c == '<' ? '[' : c == '>' ? ']' : (unsigned char)c < 32 ? ' ' : c);
    }
    return st == BS_OK ? bs_text_puts(out, ">\n") : st;
}

/* A line of a value must not look like the end of the value or of the record. */
static bs_status write_field(bs_text *out, const bs_field *field)
{
    bs_status st = write_field_name(out, field);
    bool starts = true;

    for (size_t i = 0; i < field->value_length && st == BS_OK; i++) {
        char c = field->value[i];

        if (starts && (c == '\n' || c == '>' || c == '$'))
            st = bs_text_putc(out, ' ');
        starts = c == '\n';
        if (st == BS_OK && c != '\r')
            st = bs_text_putc(out, c);
    }
    if (st == BS_OK && field->value_length > 0)
        st = bs_text_putc(out, '\n');
    return st == BS_OK ? bs_text_putc(out, '\n') : st;
}

bs_status bs_sdf_write(bs_text *out, const bs_record *record, bs_molfile_version version, int *lost)
{
    size_t length = out->length;
    bs_status st = write(out, record, version, lost);

    for (int i = 0; i < record->field_count && st == BS_OK; i++)
        st = write_field(out, &record->fields[i]);
    if (st == BS_OK)
        st = bs_text_puts(out, "$$$$\n");
    if (st != BS_OK)
        shorten(out, length);
    return st;
}
