/* The blocks of a V2000 molfile, written. */
#include "format/molfile_write.h"

static bs_status write_atom(const bs_molfile_out *o, uint32_t i)
{
    /* Charge codes for readers that know no M  CHG. */
    static const uint8_t codes[] = {7, 6, 5, 0, 3, 2, 1};
    static const bs_atom drawn_hydrogen = {.element = 1};
    bool real = i < o->mol->atom_count;
    const bs_atom *a = real ? &o->mol->atoms[i] : &drawn_hydrogen;
    bs_point at = bs_molfile__out_place(o, i);
    int valence = real ? bs_molfile__out_valence(o, i) : -1;
    bool is_group = a->element == 0 && a->label > 0;
    const char *symbol = is_group ? "R#" : bs_element_symbol(a->element);

    return bs_text_printf(o->out, "%10.4f%10.4f%10.4f %-3s 0%3d  0  0  0%3d  0  0  0%3d  0  0\n",
                          at.x, at.y, 0.0, symbol,
                          a->charge >= -3 && a->charge <= 3 ? codes[a->charge + 3] : 0,
                          valence < 0    ? 0
                          : valence == 0 ? 15
                                         : valence,
                          is_group ? 0 : a->label);
}

static bs_status write_bond(const bs_molfile_out *o, uint32_t i)
{
    bs_molfile_out_bond b = bs_molfile__out_bond(o, i);
    int stereo = b.undecided ? 3 : b.wedge == BS_WEDGE_UP ? 1 : b.wedge == BS_WEDGE_DOWN ? 6 : 0;

    return bs_text_printf(o->out, "%3u%3u%3d%3d\n", (unsigned)b.a + 1, (unsigned)b.b + 1, b.order,
                          stereo);
}

typedef int (*value_fn)(const bs_molfile_out *o, uint32_t atom);

static int charge_of(const bs_molfile_out *o, uint32_t atom)
{
    return o->mol->atoms[atom].charge;
}

static int isotope_of(const bs_molfile_out *o, uint32_t atom)
{
    return o->mol->atoms[atom].isotope;
}

static int group_of(const bs_molfile_out *o, uint32_t atom)
{
    return o->mol->atoms[atom].element == 0 ? o->mol->atoms[atom].label : 0;
}

/* The values that are not 0, eight on a line. */
static bs_status write_property(const bs_molfile_out *o, const char *word, value_fn value)
{
    uint32_t atoms[8];
    int count = 0;
    bs_status st = BS_OK;

    for (uint32_t i = 0; i <= o->mol->atom_count && st == BS_OK; i++) {
        bool last = i == o->mol->atom_count;

        if (!last && value(o, i) != 0)
            atoms[count++] = i;
        if (count == 0 || (count < 8 && !last))
            continue;
        st = bs_text_printf(o->out, "M  %s%3d", word, count);
        for (int k = 0; k < count && st == BS_OK; k++)
            st = bs_text_printf(o->out, " %3u %3d", (unsigned)atoms[k] + 1, value(o, atoms[k]));
        if (st == BS_OK)
            st = bs_text_putc(o->out, '\n');
        count = 0;
    }
    return st;
}

bs_status bs_molfile__write_v2000(const bs_molfile_out *o)
{
    bs_status st = bs_text_printf(o->out, "%3u%3u  0  0%3d  0  0  0  0  0999 V2000\n",
                                  (unsigned)o->atom_count, (unsigned)o->bond_count, o->chiral);

    for (uint32_t i = 0; i < o->atom_count && st == BS_OK; i++)
        st = write_atom(o, i);
    for (uint32_t i = 0; i < o->bond_count && st == BS_OK; i++)
        st = write_bond(o, i);
    if (st == BS_OK)
        st = write_property(o, "CHG", charge_of);
    if (st == BS_OK)
        st = write_property(o, "RAD", bs_molfile__out_radical);
    if (st == BS_OK)
        st = write_property(o, "ISO", isotope_of);
    return st == BS_OK ? write_property(o, "RGP", group_of) : st;
}
