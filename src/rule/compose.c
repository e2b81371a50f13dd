/*
 * Compiling a disconnection: target, cut and a pair of equivalents become one rewriting.
 *
 * The left side is the target, with the atoms that a rewriting of a synthon asks for besides. The
 * right side has the same atoms without the bond that is cut. Read as a pattern, for the forward
 * run, its atoms keep from the target what kind of atom they are and drop what depends on the
 * surroundings; so it fits wherever the reagents could react, and the tests of the target tell
 * the wanted product from the others.
 */
#include <string.h>

#include "backsaw/format.h"
#include "rule/book.h"

enum {
    /* What the forward run does not ask of the atoms of the target. */
    RELAXED = BS_RELAX_HYDROGENS | BS_RELAX_DEGREE | BS_RELAX_VALENCE | BS_RELAX_HYBRID |
              BS_RELAX_CHIRAL | BS_RELAX_RING | BS_RELAX_RECURSION,
    MAX_CASES = 400
};

/* One half of a disconnection. */
typedef struct half {
    const bs_equivalent_def *equivalent;
    bs_query *from, *to; /* of a rewriting */
    int **overlays;
    bs_query *fragment; /* of an attachment, NULL for hydrogen */
    int overlay_count;
    int atom;  /* of the target, at the cut */
    int ours;  /* the atom of `from` that is the cut atom */
    int order; /* of the bond to the fragment, 0: that of the bond that was cut */
} half;

/* A case being woven. */
typedef struct weave {
    bs_ctx *cx;
    bs_arena *home;
    const bs_query *target;
    bs_query *left, *right;
    int *right_of;  /* for each atom of `left`, or -1 */
    int *owner;     /* for each atom of `left`: 1 + number of the half whose rewriting names it */
    int *newcomer;  /* for each half: the atom of `right` bonded to the cut atom, or -1 */
    int room;       /* of those arrays */
    int next_map;
    int cut_bond;   /* bond of the target */
    bs_bond_facts cut;
} weave;

/* ---- Reading equivalents -------------------------------------------------------------------- */

static int twin_of(const bs_query *query, int map)
{
    for (int i = 0; i < query->atom_count && map > 0; i++) {
        if (query->atoms[i].map == map)
            return i;
    }
    return -1;
}

static bs_status read_rewriting(bs_ctx *cx, bs_arena *home, const char *text, half *h)
{
    size_t right_at;
    bs_status st = bs_rewrite__read_sides(cx, home, text, strlen(text), &h->from, &h->to,
                                          &right_at);

    if (st != BS_OK)
        return st;
    h->ours = -1;
    for (int i = 0; i < h->from->atom_count; i++) {
        if (h->from->atoms[i].map == 1)
            h->ours = i;
    }
    if (h->ours < 0)
        return bs_fail_at(cx, BS_EVALUE, 0, "expected an atom with map number 1, the cut atom");
    if (twin_of(h->to, 1) < 0)
        return bs_fail_at(cx, BS_EVALUE, right_at, "expected the cut atom, map number 1, to stay");
    return BS_OK;
}

static int bond_symbol(char c)
{
    switch (c) {
    case '-':
        return 1;
    case '=':
        return 2;
    case '#':
        return 3;
    default:
        return 0;
    }
}

static bs_status read_attachment(bs_ctx *cx, bs_arena *home, const char *text, half *h)
{
    bs_mark temp = bs_arena_mark(&cx->scratch);
    int skipped = (h->order = bond_symbol(text[0])) > 0;
    size_t length = strlen(text + skipped), used;
    bs_mol *check;
    bs_status st;

    if (strcmp(text + skipped, "[H]") == 0)
        return BS_OK;
    st = bs_smiles_read(cx, &cx->scratch, text + skipped, length, &used, &check);
    bs_arena_rewind(&cx->scratch, temp);
    if (st == BS_OK && used != length)
        st = bs_fail_at(cx, BS_ESYNTAX, used, "expected the end of the SMILES");
    if (st != BS_OK) {
        if (cx->error.offset >= 0)
            cx->error.offset += skipped;
        return st;
    }
    return bs_query_read(cx, home, text + skipped, length, (size_t)skipped, &h->fragment);
}

static bs_status read_half(bs_ctx *cx, bs_arena *home, const bs_equivalent_def *equivalent,
                           int atom, half *h)
{
    *h = (half){.equivalent = equivalent, .atom = atom, .ours = -1};
    if (equivalent->rewrite)
        return read_rewriting(cx, home, equivalent->rewrite, h);
    return read_attachment(cx, home, equivalent->attach, h);
}

/* ---- The left side ---------------------------------------------------------------------------- */

static int find_bond(const bs_query *query, int a, int b)
{
    for (int i = 0; i < query->bond_count; i++) {
        const bs_query_bond *bond = &query->bonds[i];

        if ((bond->a == a && bond->b == b) || (bond->a == b && bond->b == a))
            return i;
    }
    return -1;
}

/* Adds to the left side what the rewriting of a half asks; `bound` gets the atoms that it added. */
static bs_status overlay_half(weave *w, const half *h, int number, int *bound)
{
    const bs_query *from = h->from;
    bs_status st = BS_OK;

    for (int i = 0; i < from->atom_count && st == BS_OK; i++) {
        bs_query_atom atom = {.map = w->next_map};
        bs_query_expr expr;

        st = bs_query_import(w->cx, w->home, w->left, from, &from->atoms[i].expr, &expr);
        if (st != BS_OK)
            return st;
        if (bound[i] >= 0) {
            bs_query_expr *both = &w->left->atoms[bound[i]].expr;

            st = bs_query_join(w->cx, w->home, BS_TEST_AND, both, &expr, both);
        } else {
            atom.expr = expr;
            w->next_map++;
            st = bs_query_add_atom(w->cx, w->home, w->left, &atom, &bound[i]);
        }
        w->owner[bound[i]] = number + 1;
    }
    for (int i = 0; i < from->bond_count && st == BS_OK; i++) {
        bs_query_bond bond = from->bonds[i];

        bond.a = bound[bond.a];
        bond.b = bound[bond.b];
        if (find_bond(w->left, bond.a, bond.b) < 0)
            st = bs_query_add_bond(w->cx, w->home, w->left, &bond, NULL);
    }
    return st;
}

/* ---- The right side: atoms of the target ---------------------------------------------------------- */

static bs_status add_right(weave *w, bs_query_expr expr, int map, int *index)
{
    bs_query_atom atom = {.expr = expr, .map = map};

    return bs_query_add_atom(w->cx, w->home, w->right, &atom, index);
}

static bs_status carry_atoms(weave *w)
{
    bs_status st = BS_OK;

    for (int i = 0; i < w->left->atom_count && st == BS_OK; i++) {
        bs_query_expr expr;

        if (w->owner[i] > 0)
            continue;
        st = bs_query_relax_expr(w->cx, w->home, &w->target->atoms[i].expr, RELAXED, &expr);
        if (st == BS_OK)
            st = add_right(w, expr, w->left->atoms[i].map, &w->right_of[i]);
    }
    return st;
}

static bs_status carry_bonds(weave *w)
{
    bs_status st = BS_OK;

    for (int i = 0; i < w->left->bond_count && st == BS_OK; i++) {
        bs_query_bond bond = w->left->bonds[i];
        bool same_half = w->owner[bond.a] > 0 && w->owner[bond.a] == w->owner[bond.b];

        if (i == w->cut_bond || w->right_of[bond.a] < 0 || w->right_of[bond.b] < 0 || same_half)
            continue;
        st = bs_query_relax_expr(w->cx, w->home, &w->left->bonds[i].expr, BS_RELAX_RING, &bond.expr);
        bond.a = w->right_of[bond.a];
        bond.b = w->right_of[bond.b];
        if (st == BS_OK)
            st = bs_query_add_bond(w->cx, w->home, w->right, &bond, NULL);
    }
    return st;
}

/* ---- The right side: equivalents --------------------------------------------------------------------- */

/* The right side of a half's rewriting. `bound` leads from its left atoms to atoms of `left`. */
static bs_status rewrite_half(weave *w, const half *h, const int *bound)
{
    const bs_query *to = h->to;
    bs_mark temp = bs_arena_mark(&w->cx->scratch);
    int *placed;
    bs_status st = bs_new(w->cx, &w->cx->scratch, to->atom_count + 1, &placed);

    for (int i = 0; i < to->atom_count && st == BS_OK; i++) {
        int twin = twin_of(h->from, to->atoms[i].map);
        int map = twin >= 0 ? w->left->atoms[bound[twin]].map : 0;
        bs_query_expr expr;

        st = bs_query_import(w->cx, w->home, w->right, to, &to->atoms[i].expr, &expr);
        if (st == BS_OK)
            st = add_right(w, expr, map, &placed[i]);
        if (st == BS_OK && twin >= 0)
            w->right_of[bound[twin]] = placed[i];
    }
    for (int i = 0; i < to->bond_count && st == BS_OK; i++) {
        bs_query_bond bond = to->bonds[i];

        bond.a = placed[bond.a];
        bond.b = placed[bond.b];
        st = bs_query_add_bond(w->cx, w->home, w->right, &bond, NULL);
    }
    bs_arena_rewind(&w->cx->scratch, temp);
    return st;
}

static bs_status and_test(weave *w, bs_query_expr *expr, bs_test_kind kind, int value, bool negated)
{
    bs_query_expr leaf;
    bs_status st = bs_query_leaf(w->cx, w->home, kind, value, &leaf);

    if (st == BS_OK && negated)
        st = bs_query_join(w->cx, w->home, BS_TEST_NOT, &leaf, NULL, &leaf);
    if (st != BS_OK)
        return st;
    return bs_query_join(w->cx, w->home, BS_TEST_AND, expr, &leaf, expr);
}

/* "[H]": the cut atom has as many hydrogens more as the bond had orders. */
static bs_status leave_hydrogen(weave *w, int cut_atom, int order)
{
    bs_status st = BS_OK;

    for (int i = 0; i < order && st == BS_OK; i++)
        st = and_test(w, &w->right->atoms[cut_atom].expr, BS_TEST_HYDROGENS, i, true);
    return st;
}

/* Appends the fragment; each atom has exactly the neighbours that the fragment says. */
static bs_status append_fragment(weave *w, const half *h, int *first)
{
    const bs_query *fragment = h->fragment;
    bs_status st = bs_query_append(w->cx, w->home, w->right, fragment, first);

    for (int i = 0; i < fragment->atom_count && st == BS_OK; i++) {
        int degree = i == 0 && !h->equivalent->ionic;

        for (int k = 0; k < fragment->bond_count; k++)
            degree += fragment->bonds[k].a == i || fragment->bonds[k].b == i;
        w->right->atoms[*first + i].map = 0;
        st = and_test(w, &w->right->atoms[*first + i].expr, BS_TEST_DEGREE, degree, false);
    }
    return st;
}

/* A charge on an atom instead of the one that its expression says. */
static bs_status set_charge(weave *w, bs_query_expr *expr, int charge)
{
    bs_status st = bs_query_relax_expr(w->cx, w->home, expr, BS_RELAX_CHARGE, expr);

    return st == BS_OK ? and_test(w, expr, BS_TEST_CHARGE, charge, false) : st;
}

static bs_status part_with_ions(weave *w, const half *h, int cut_atom, int first)
{
    bs_facts cut, cation;
    bs_status st;

    st = bs_expr__atom_facts(w->cx, &w->left->atoms[h->atom].expr, &cut);
    if (st == BS_OK)
        st = bs_expr__atom_facts(w->cx, &w->right->atoms[first].expr, &cation);
    if (st == BS_OK)
        st = set_charge(w, &w->right->atoms[cut_atom].expr,
                        (cut.charge == BS_UNSAID ? 0 : cut.charge) - 1);
    if (st == BS_OK && (cation.charge == BS_UNSAID || cation.charge == 0))
        st = set_charge(w, &w->right->atoms[first].expr, 1);
    return st;
}

/* The bond to the newcomer; a direction of the bond that was cut is kept. */
static bs_status bond_newcomer(weave *w, const half *h, int cut_atom, int first, int order)
{
    static const uint8_t kinds[] = {BS_TEST_BOND_SINGLE, BS_TEST_BOND_SINGLE, BS_TEST_BOND_DOUBLE,
                                    BS_TEST_BOND_TRIPLE};
    const bs_query_bond *cut = &w->target->bonds[w->cut_bond];
    bs_query_bond bond = {.a = cut_atom, .b = first};
    int kind = kinds[order >= 1 && order <= 3 ? order : 1];
    bs_status st;

    if (order == 1 && w->cut.slope != BS_UNSAID) {
        bool up = (w->cut.slope == 1) == (cut->a == h->atom);

        kind = up ? BS_TEST_BOND_UP : BS_TEST_BOND_DOWN;
    }
    st = bs_query_leaf(w->cx, w->home, (bs_test_kind)kind, 0, &bond.expr);
    return st == BS_OK ? bs_query_add_bond(w->cx, w->home, w->right, &bond, NULL) : st;
}

static bs_status attach_half(weave *w, const half *h, int number)
{
    int cut_atom = w->right_of[h->atom];
    int order = h->order ? h->order : w->cut.order;
    int first;
    bs_status st;

    if (order < 1 || order > 3)
        order = 1;
    if (!h->fragment)
        return leave_hydrogen(w, cut_atom, order);
    if ((st = append_fragment(w, h, &first)) != BS_OK)
        return st;
    if (h->equivalent->ionic)
        return part_with_ions(w, h, cut_atom, first);
    w->newcomer[number] = first;
    return bond_newcomer(w, h, cut_atom, first, order);
}

/* ---- Finishing touches ----------------------------------------------------------------------------------- */

/* Centres that the target marks stay as they are: the newcomer stands where the other half stood. */
static bs_status carry_hands(weave *w, const half halves[2])
{
    bs_status st = BS_OK;

    for (int i = 0; i < w->target->atom_count && st == BS_OK; i++) {
        const bs_query_atom *was = &w->target->atoms[i];
        bs_query_atom *now = w->right_of[i] >= 0 ? &w->right->atoms[w->right_of[i]] : NULL;
        int mark;

        if (!now || w->owner[i] > 0 || was->around_count == 0 ||
            !bs_query_demands(&was->expr, BS_TEST_CHIRAL, &mark))
            continue;
        if ((st = bs_new(w->cx, w->home, was->around_count, &now->around)) != BS_OK)
            return st;
        now->around_count = was->around_count;
        for (int k = 0; k < was->around_count; k++) {
            int other = was->around[k];

            now->around[k] = other >= 0 ? w->right_of[other] : -1;
            for (int n = 0; n < 2; n++) {
                if (i == halves[n].atom && other == halves[1 - n].atom)
                    now->around[k] = w->newcomer[n];
            }
        }
        st = and_test(w, &now->expr, BS_TEST_CHIRAL, mark, false);
    }
    return st;
}

/* A cut in a ring leaves one molecule: what hangs together with the cut atoms is one group. */
static void group_halves(weave *w, const half halves[2])
{
    bool again = true;

    if (w->cut.ring != 1)
        return;
    for (int n = 0; n < 2; n++)
        w->right->atoms[w->right_of[halves[n].atom]].component = 1;
    while (again) {
        again = false;
        for (int i = 0; i < w->right->bond_count; i++) {
            bs_query_atom *a = &w->right->atoms[w->right->bonds[i].a];
            bs_query_atom *b = &w->right->atoms[w->right->bonds[i].b];

            again = again || a->component != b->component;
            a->component = b->component = a->component | b->component;
        }
    }
}

static bs_status start_weave(weave *w, const half halves[2])
{
    bs_status st;

    w->room = w->target->atom_count + 2 * 40;
    w->next_map = BS_OWN_MAPS;
    if ((st = bs_query_copy(w->cx, w->home, w->target, &w->left)) != BS_OK ||
        (st = bs_query_new(w->cx, w->home, &w->right)) != BS_OK ||
        (st = bs_new(w->cx, w->home, w->room, &w->right_of)) != BS_OK ||
        (st = bs_new(w->cx, w->home, w->room, &w->owner)) != BS_OK ||
        (st = bs_new(w->cx, w->home, 2, &w->newcomer)) != BS_OK)
        return st;
    w->left->text = NULL;
    for (int i = 0; i < w->room; i++)
        w->right_of[i] = -1;
    w->newcomer[0] = w->newcomer[1] = -1;
    for (int i = 0; i < w->left->atom_count; i++) {
        if (w->left->atoms[i].map == 0)
            w->left->atoms[i].map = w->next_map++;
    }
    w->cut_bond = find_bond(w->target, halves[0].atom, halves[1].atom);
    return bs_expr__bond_facts(w->cx, &w->target->bonds[w->cut_bond].expr, &w->cut);
}

/* One case; `choice` says which overlay each half uses. */
static bs_status weave_case(bs_ctx *cx, bs_arena *home, const bs_query *target, const half halves[2],
                            const int choice[2], bs_case *out)
{
    weave w = {.cx = cx, .home = home, .target = target};
    int *bound[2] = {NULL, NULL};
    bs_status st = start_weave(&w, halves);

    for (int n = 0; n < 2 && st == BS_OK; n++) {
        if (!halves[n].from)
            continue;
        if ((st = bs_new(cx, home, halves[n].from->atom_count + 1, &bound[n])) != BS_OK)
            return st;
        memcpy(bound[n], halves[n].overlays[choice[n]],
               (size_t)halves[n].from->atom_count * sizeof **bound);
        st = overlay_half(&w, &halves[n], n, bound[n]);
    }
    if (st == BS_OK)
        st = carry_atoms(&w);
    for (int n = 0; n < 2 && st == BS_OK; n++) {
        if (halves[n].from)
            st = rewrite_half(&w, &halves[n], bound[n]);
    }
    if (st == BS_OK)
        st = carry_bonds(&w);
    for (int n = 0; n < 2 && st == BS_OK; n++) {
        if (!halves[n].from)
            st = attach_half(&w, &halves[n], n);
    }
    if (st != BS_OK || (st = carry_hands(&w, halves)) != BS_OK)
        return st;
    group_halves(&w, halves);
    if ((st = bs_case__make(cx, home, w.left, w.right, out)) != BS_OK)
        return st;
    for (int n = 0; n < 2; n++) {
        double amount = halves[n].equivalent->equivalents;
        int part = out->source.atoms[w.right_of[halves[n].atom]].part;

        if (amount > 0)
            out->equivalents[part] = amount;
    }
    return BS_OK;
}

/* ---- All pairs ------------------------------------------------------------------------------------------- */

static bs_status read_equivalents(bs_ctx *cx, bs_arena *home, const bs_query *target,
                                  const bs_synthon *synthon, int atom, int other, half **out)
{
    int count = synthon->def.equivalent_count;
    bs_status st = bs_new(cx, home, count + 1, out);

    for (int i = 0; i < count && st == BS_OK; i++) {
        half *h = &(*out)[i];

        st = read_half(cx, home, &synthon->def.equivalents[i], atom, h);
        if (st == BS_OK && h->from)
            st = bs_overlay__find(cx, home, h->from, h->ours, target, atom, other, &h->overlays,
                                  &h->overlay_count);
        if (!h->from)
            h->overlay_count = 1;
    }
    return st;
}

static bs_status check_cut(bs_ctx *cx, const bs_query *target, const bs_transform_def *def,
                           int atoms[2])
{
    bool straight = def->acceptor_map == def->cut[0] && def->donor_map == def->cut[1];
    bool crossed = def->acceptor_map == def->cut[1] && def->donor_map == def->cut[0];

    if (!straight && !crossed)
        return bs_fail(cx, BS_EVALUE, "acceptor and donor have to be the two atoms of the cut");
    atoms[0] = twin_of(target, def->acceptor_map);
    atoms[1] = twin_of(target, def->donor_map);
    for (int i = 0; i < 2; i++) {
        if (atoms[i] < 0)
            return bs_fail(cx, BS_EVALUE, "cut: the target has no atom with map number %d",
                           i == 0 ? def->acceptor_map : def->donor_map);
    }
    if (find_bond(target, atoms[0], atoms[1]) < 0)
        return bs_fail(cx, BS_EVALUE, "cut: the target has no bond between atoms %d and %d",
                       def->cut[0], def->cut[1]);
    return BS_OK;
}

static bs_status weave_pair(bs_ctx *cx, bs_arena *home, const bs_query *target, const half pair[2],
                            bs_case *cases, int *count)
{
    bs_status st = BS_OK;

    for (int i = 0; i < pair[0].overlay_count && st == BS_OK; i++) {
        for (int k = 0; k < pair[1].overlay_count && st == BS_OK; k++) {
            int choice[2] = {i, k};

            st = weave_case(cx, home, target, pair, choice, &cases[(*count)++]);
        }
    }
    return st;
}

bs_status bs_compose__cut(bs_ctx *cx, bs_arena *home, const bs_query *target,
                          const bs_transform_def *def, const bs_synthon *acceptor,
                          const bs_synthon *donor, bs_case **cases, int *count)
{
    half *acceptors, *donors;
    int atoms[2], total = 0;
    bs_status st;

    *count = 0;
    if ((st = check_cut(cx, target, def, atoms)) != BS_OK)
        return st;
    st = read_equivalents(cx, home, target, acceptor, atoms[0], atoms[1], &acceptors);
    if (st != BS_OK)
        return bs_blame(cx, st, "acceptor");
    st = read_equivalents(cx, home, target, donor, atoms[1], atoms[0], &donors);
    if (st != BS_OK)
        return bs_blame(cx, st, "donor");
    for (int i = 0; i < acceptor->def.equivalent_count; i++) {
        for (int k = 0; k < donor->def.equivalent_count; k++)
            total += acceptors[i].overlay_count * donors[k].overlay_count;
    }
    if (total > MAX_CASES)
        return bs_fail(cx, BS_ELIMIT, "more than %d pairs of equivalents", MAX_CASES);
    if ((st = bs_new(cx, home, total + 1, cases)) != BS_OK)
        return st;
    for (int i = 0; i < acceptor->def.equivalent_count; i++) {
        for (int k = 0; k < donor->def.equivalent_count; k++) {
            half pair[2] = {acceptors[i], donors[k]};

            if ((st = weave_pair(cx, home, target, pair, *cases, count)) != BS_OK)
                return st;
        }
    }
    return BS_OK;
}
