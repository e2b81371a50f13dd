/* Tests of single atoms, recursion included. */
#include "match/run.h"

/* sp3 is 3, sp2 and aromatic 2, sp 1: by the double and triple bonds at the atom. */
static int hybrid(const bs_mol *mol, uint32_t where)
{
    const bs_bond *bonds = bs_mol__bonds(mol);
    const bs_link *links = bs_mol__links(mol, where);
    int unsaturated = 0;

    if (mol->atoms[where].flags & BS_ATOM_AROMATIC)
        return 2;
    for (int k = 0; k < mol->atoms[where].degree; k++) {
        int order = (int)bonds[links[k].bond].order;

        unsaturated += order > 1 ? order - 1 : 0;
    }
    return unsaturated >= 2 ? 1 : 3 - unsaturated;
}

static bool connections_are(const bs_mol *mol, uint32_t where, int value)
{
    return mol->atoms[where].degree + mol->atoms[where].hydrogens == value;
}

/* Looks a recursive part up, or searches it with its first atom on `where`. */
static bool recurse(bs_match_run *run, int number, uint32_t where)
{
    uint8_t *memo = &run->memo[(size_t)number * run->mol->atom_count + where];
    bs_mark mark;
    bs_match_search search;
    bool found = false;

    if (*memo != BS_MEMO_OPEN)
        return *memo == BS_MEMO_YES;
    mark = bs_arena_mark(&run->cx->scratch);
    run->status = bs_match__search(&search, run, run->whole->subs[number]);
    if (run->status == BS_OK) {
        search.anchor = where;
        search.anchor_atom = 0;
        found = bs_match__next(&search);
    }
    bs_arena_rewind(&run->cx->scratch, mark);
    *memo = found ? BS_MEMO_YES : BS_MEMO_NO;
    return found;
}

static bool test(bs_match_run *run, const bs_code *code, uint32_t where, int hand)
{
    const bs_atom *atom = &run->mol->atoms[where];
    int value = code->value;

    switch (code->kind) {
    case BS_TEST_ANY:
        return true;
    case BS_TEST_ELEMENT:
        return atom->element == value;
    case BS_TEST_ALIPHATIC_ELEM:
        return atom->element == value && !(atom->flags & BS_ATOM_AROMATIC);
    case BS_TEST_AROMATIC_ELEM:
        return atom->element == value && atom->flags & BS_ATOM_AROMATIC;
    case BS_TEST_ALIPHATIC:
        return !(atom->flags & BS_ATOM_AROMATIC);
    case BS_TEST_AROMATIC:
        return atom->flags & BS_ATOM_AROMATIC;
    case BS_TEST_ISOTOPE:
        return atom->isotope == value;
    case BS_TEST_DEGREE:
        return atom->degree == value;
    case BS_TEST_HYDROGENS:
        return bs_mol__total_hydrogens(run->mol, where) == value;
    case BS_TEST_IMPLICIT_H:
        return value < 0 ? atom->hydrogens > 0 : atom->hydrogens == value;
    case BS_TEST_RING_COUNT:
        return value < 0 ? atom->ring_bonds > 0 : atom->ring_count == value;
    case BS_TEST_RING_SIZE:
        return value < 0 ? atom->ring_bonds > 0 : atom->min_ring == value;
    case BS_TEST_VALENCE:
        return atom->valence == value;
    case BS_TEST_CONNECTIONS:
        return connections_are(run->mol, where, value);
    case BS_TEST_RING_BONDS:
        return value < 0 ? atom->ring_bonds > 0 : atom->ring_bonds == value;
    case BS_TEST_CHARGE:
        return atom->charge == value;
    case BS_TEST_HYBRID:
        return hybrid(run->mol, where) == value;
    case BS_TEST_CHIRAL:
        return value > 2 ? hand == 0 || hand == value - 2 : hand == value;
    case BS_TEST_RECURSE:
        return recurse(run, value, where);
    default:
        return false;
    }
}

bool bs_match__atom(bs_match_run *run, const bs_program_expr *expr, uint32_t where, int hand)
{
    int at = expr->entry;

    while (at >= 0 && run->status == BS_OK) {
        const bs_code *code = &expr->code[at];

        at = test(run, code, where, hand) ? code->yes : code->no;
    }
    return at == BS_CODE_PASS && run->status == BS_OK;
}
