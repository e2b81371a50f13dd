/* From the table of a molfile to a molecule. */
#include "chem/valence.h"
#include "format/molfile.h"
#include "format/utf8.h"

#include <string.h>

/* What the bonds around an atom add up to. */
typedef struct bond_sum {
    int16_t orders;   /* without aromatic bonds */
    int16_t aromatic; /* number of aromatic bonds */
} bond_sum;

static bs_status sum_bonds(const bs_molfile *file, bond_sum **out)
{
    bond_sum *sums;
    bs_status st = bs_new(file->cx, &file->cx->scratch, file->atom_count, out);

    if (st != BS_OK)
        return st;
    sums = *out;
    for (uint32_t i = 0; i < file->bond_count; i++) {
        const bs_molfile_bond *b = &file->bonds[i];
        int order = b->type <= 3 ? b->type : 0;
        int aromatic = b->type == BS_MOLFILE_BOND_AROMATIC;

        if (sums[b->a].orders > 1000 || sums[b->b].orders > 1000)
            return bs_scan__fail_line(file->cx, b->line, BS_ELIMIT, "an atom with too many bonds");
        sums[b->a].orders = (int16_t)(sums[b->a].orders + order);
        sums[b->b].orders = (int16_t)(sums[b->b].orders + order);
        sums[b->a].aromatic = (int16_t)(sums[b->a].aromatic + aromatic);
        sums[b->b].aromatic = (int16_t)(sums[b->b].aromatic + aromatic);
    }
    return BS_OK;
}

/*
 * Hydrogens beside those that are drawn. A stated valence counts all bonds; it says nothing of
 * use on an aromatic atom, where the orders are not known yet. A radical keeps one or two bonds
 * free.
 */
static int16_t hydrogens_of(const bs_molfile_atom *atom, bond_sum sum)
{
    int unpaired = atom->radical == 0 ? 0 : atom->radical == 2 ? 1 : 2;

    if (atom->element == 1)
        return 0;
    if (atom->hydrogens >= 0)
        return atom->hydrogens;
    if (sum.aromatic > 0)
        return BS_DRAFT_IMPLIED;
    if (atom->valence >= 0)
        return (int16_t)(atom->valence > sum.orders ? atom->valence - sum.orders : 0);
    if (unpaired > 0)
        return (int16_t)bs_valence__implied(atom->element, atom->charge, sum.orders + unpaired);
    return BS_DRAFT_IMPLIED;
}

static bs_status add_atoms(const bs_molfile *file, bs_draft *draft)
{
    bond_sum *sums;
    bs_status st = sum_bonds(file, &sums);

    for (uint32_t i = 0; i < file->atom_count && st == BS_OK; i++) {
        const bs_molfile_atom *a = &file->atoms[i];

        st = bs_draft_add_atom(draft,
                               (bs_draft_atom){.element = a->element,
                                               .charge = a->charge,
                                               .hydrogens = hydrogens_of(a, sums[i]),
                                               .isotope = a->isotope,
                                               .label = a->label,
                                               .aromatic = sums[i].aromatic > 0},
                               NULL);
    }
    return st;
}

static bs_status add_bonds(const bs_molfile *file, bs_draft *draft)
{
    bs_status st = BS_OK;

    for (uint32_t i = 0; i < file->bond_count && st == BS_OK; i++) {
        const bs_molfile_bond *b = &file->bonds[i];
        int order = b->type == BS_MOLFILE_BOND_AROMATIC ? BS_DRAFT_ORDER_AROMATIC
                    : b->type <= 3                      ? b->type
                                                        : 0;

        if (b->type != BS_MOLFILE_BOND_HYDROGEN)
            st = bs_draft_add_bond(draft, b->a, b->b, order, NULL);
    }
    return st;
}

static bs_status finish(const bs_molfile *file, bs_draft *draft, bs_arena *home, uint32_t **order,
                        bs_mol **mol)
{
    bs_status st = bs_draft_finish(draft, home, order, mol);
    char text[BS_MESSAGE_MAX];
    long atom = file->cx->error.offset;

    if ((st != BS_EVALUE && st != BS_ELIMIT) || atom < 0 || atom >= (long)file->atom_count)
        return st;
    memcpy(text, file->cx->error.message, sizeof text);
    return bs_scan__fail_line(file->cx, file->atoms[atom].line, st, "%.300s", text);
}

/* The stereo groups with the atoms of the molecule; folded hydrogens are no members. */
static bs_status copy_groups(const bs_molfile *file, bs_arena *home, const uint32_t *order,
                             bs_record *record)
{
    bs_stereo_group *groups;
    bs_status st = bs_new(file->cx, home, file->group_count, &groups);

    for (uint32_t i = 0; i < file->group_count && st == BS_OK; i++) {
        const bs_molfile_group *from = &file->groups[i];
        int *atoms;
        int count = 0;

        st = bs_new(file->cx, home, from->count, &atoms);
        for (uint32_t k = 0; k < from->count && st == BS_OK; k++) {
            if (order[from->atoms[k]] != UINT32_MAX)
                atoms[count++] = (int)order[from->atoms[k]];
        }
        groups[i] = (bs_stereo_group){
            .kind = from->kind, .number = from->number, .atom_count = count, .atoms = atoms};
    }
    record->groups = groups;
    record->group_count = (int)file->group_count;
    return st;
}

bs_status bs_molfile__build(const bs_molfile *file, bs_arena *home, bs_record *record)
{
    bs_ctx *cx = file->cx;
    bs_mark temp = bs_arena_mark(&cx->scratch);
    bs_draft draft;
    uint32_t *order;
    bs_mol *mol;
    char *name;
    bs_status st;

    bs_draft_init(&draft, cx, &cx->scratch);
    if ((st = add_atoms(file, &draft)) != BS_OK || (st = add_bonds(file, &draft)) != BS_OK ||
        (st = bs_molfile__add_stereo(file, &draft)) != BS_OK ||
        (st = finish(file, &draft, home, &order, &mol)) != BS_OK ||
        (st = copy_groups(file, home, order, record)) != BS_OK ||
        (st = bs_utf8__copy(cx, home, file->name, file->name_length, &name,
                            &record->name_length)) != BS_OK)
        goto done;
    record->mol = mol;
    record->name = name;
    record->chiral = file->chiral;
done:
    if (home != &cx->scratch)
        bs_arena_rewind(&cx->scratch, temp);
    return st;
}
