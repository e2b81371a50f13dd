/* The constraints of constraint.h. */
#include "search/constraint.h"

#include "backsaw/format.h"
#include "search/plan.h"

#include <ctype.h>
#include <math.h>
#include <string.h>
#include <strings.h>

#define MOST_TESTS 64

/* ---- Reading --------------------------------------------------------------------------------- */

static bs_status read_tests(bs_plan_state *plan, const bs_step_test *tests, int count,
                            const char ***out)
{
    bs_status st = bs_new(plan->cx, &plan->arena, count, out);

    for (int i = 0; st == BS_OK && i < count; i++) {
        char *smiles = NULL;

        if (tests[i].mol)
            st = bs_smiles_canonical(plan->cx, &plan->arena, tests[i].mol, 0, &smiles);
        else if (tests[i].word || tests[i].transform)
            plan->con.by_way = true;
        (*out)[i] = smiles;
    }
    return st;
}

static bs_status read_mols(bs_plan_state *plan, const bs_mol *const *mols, int count,
                           const char ***out)
{
    bs_status st = bs_new(plan->cx, &plan->arena, count, out);

    for (int i = 0; st == BS_OK && i < count; i++) {
        char *smiles = NULL;

        st = bs_smiles_canonical(plan->cx, &plan->arena, mols[i], 0, &smiles);
        (*out)[i] = smiles;
    }
    return st;
}

/* The tag of an atom of the target; it gets the next one if it has none. */
static bs_status tag_atom(bs_plan_state *plan, const bs_mol *target, uint16_t *isotope, int atom,
                          int *tag)
{
    bs_tags *tags = &plan->con.tags;

    if (isotope[atom] == 0) {
        if (tags->count == BS_TAG_MOST)
            return bs_fail(plan->cx, BS_EVALUE, "constraints: more than %d marked atoms",
                           BS_TAG_MOST);
        tags->isotope[tags->count] = (uint16_t)bs_mol_atom_isotope(target, atom);
        isotope[atom] = (uint16_t)(BS_TAG_FIRST + tags->count++);
    }
    *tag = isotope[atom] - BS_TAG_FIRST;
    return BS_OK;
}

static bs_status tag_bonds(bs_plan_state *plan, const bs_mol *target, uint16_t *isotope,
                           const bs_target_bond *bonds, int count, int wish)
{
    bs_status st = BS_OK;

    for (int i = 0; st == BS_OK && i < count; i++) {
        bs_tagged_bond *bond = &plan->con.bonds[plan->con.bond_count++];
        int atoms = bs_mol_atom_count(target), a = bonds[i].a, b = bonds[i].b;

        if (a < 0 || b < 0 || a >= atoms || b >= atoms || bs_mol_bond_between(target, a, b) < 0)
            return bs_fail(plan->cx, BS_EVALUE,
                           "constraints: there is no bond between atoms %d and %d of the target",
                           a + 1, b + 1);
        bond->wish = wish;
        if ((st = tag_atom(plan, target, isotope, a, &bond->a)) == BS_OK)
            st = tag_atom(plan, target, isotope, b, &bond->b);
    }
    return st;
}

static bs_status read_bonds(bs_plan_state *plan, const bs_mol *target, const bs_mol **tagged)
{
    const bs_constraints *given = plan->con.given;
    uint16_t *isotope;
    bs_mol *copy;
    bs_status st;

    if (given->keep_count + given->cut_count + given->first_count == 0)
        return BS_OK;
    if ((st = bs_new(plan->cx, &plan->arena, bs_mol_atom_count(target), &isotope)) != BS_OK ||
        (st = bs_new(plan->cx, &plan->arena,
                     given->keep_count + given->cut_count + given->first_count,
                     &plan->con.bonds)) != BS_OK ||
        (st = tag_bonds(plan, target, isotope, given->keep, given->keep_count, BS_BOND_KEEP)) ||
        (st = tag_bonds(plan, target, isotope, given->cut, given->cut_count, BS_BOND_CUT)) ||
        (st = tag_bonds(plan, target, isotope, given->first, given->first_count, BS_BOND_FIRST)) ||
        (st = bs_tag__put(plan->cx, &plan->arena, target, isotope, &copy)) != BS_OK)
        return st;
    *tagged = copy;
    return BS_OK;
}

bs_status bs_constraint__init(bs_plan_state *plan, const bs_mol *target, const bs_mol **tagged)
{
    const bs_constraints *given = plan->opts->constraints;
    bs_constraint *con = &plan->con;
    bs_status st;

    *tagged = target;
    bs_arena_init(&con->product_home, plan->cx->gate);
    if (!given)
        return BS_OK;
    con->given = given;
    if (given->use_count + given->at_most_count > MOST_TESTS)
        return bs_fail(plan->cx, BS_EVALUE, "constraints: more than %d in use and at_most",
                       MOST_TESTS);
    con->by_way = given->has_protections || given->unprotect;
    con->whole = con->by_way || given->convergent || given->use_count > 0 ||
                 given->at_most_count > 0 || given->start_count > 0;
    if ((st = read_tests(plan, given->use, given->use_count, &con->use)) != BS_OK ||
        (st = read_tests(plan, given->at_most, given->at_most_count, &con->at_most)) != BS_OK)
        return st;
    { /* what is avoided leaves no way to choose from */
        bool by_way = con->by_way;

        st = read_tests(plan, given->avoid, given->avoid_count, &con->avoid);
        con->by_way = by_way;
    }
    if (st != BS_OK ||
        (st = read_mols(plan, given->start, given->start_count, &con->start)) != BS_OK ||
        (st = read_mols(plan, given->not_bought, given->not_bought_count, &con->not_bought)) ||
        (st = bs_new(plan->cx, &plan->arena, given->intact_count, &con->intact)) != BS_OK)
        return st;
    return read_bonds(plan, target, tagged);
}

void bs_constraint__free(bs_plan_state *plan)
{
    bs_constraint *con = &plan->con;
    bs_gate *gate = plan->cx->gate;

    bs_gate_free(gate, con->marks, con->marks_room * sizeof *con->marks);
    bs_gate_free(gate, con->marked, con->marked_room * sizeof *con->marked);
    bs_arena_free(&con->product_home);
}

/* ---- Tests of a step ------------------------------------------------------------------------- */

/* Does `word` stand at the beginning of a word in `text`, whatever the case? */
static bool names(const char *text, const char *word)
{
    size_t length = strlen(word);

    for (const char *at = text; text && *at; at++) {
        size_t same = 0;

        if (at > text && isalpha((unsigned char)at[-1]))
            continue;
        while (same < length && at[same] &&
               tolower((unsigned char)at[same]) == tolower((unsigned char)word[same]))
            same++;
        if (same == length)
            return true;
    }
    return false;
}

static bool any_names(const bs_words *words, const char *word)
{
    for (int i = 0; i < words->count; i++) {
        if (names(words->items[i], word))
            return true;
    }
    return false;
}

/* A step to be tested: its way and its plain precursors; their structures are read when needed. */
typedef struct subject {
    bs_route_way way;
    const char **smiles;
    const bs_mol **mols;
    int count;
    bs_arena home; /* not the scratch arena, which callees rewind */
} subject;

static bs_status has_pattern(bs_ctx *cx, subject *s, const bs_pattern *pattern, bool *yes)
{
    bs_status st = BS_OK;

    for (int i = 0; st == BS_OK && !*yes && i < s->count; i++) {
        if (!s->mols[i]) {
            bs_mol *mol;

            st = bs_smiles_read(cx, &s->home, s->smiles[i], strlen(s->smiles[i]), NULL, &mol);
            s->mols[i] = mol;
        }
        if (st == BS_OK)
            st = bs_pattern_has(cx, pattern, s->mols[i], yes);
    }
    return st;
}

static bs_status meets(bs_ctx *cx, subject *s, const bs_step_test *test, const char *smiles,
                       bool *yes)
{
    *yes = false;
    if (test->word)
        *yes = any_names(&s->way.reagents, test->word) || any_names(&s->way.cautions, test->word) ||
               names(s->way.recipe, test->word) || names(s->way.conditions, test->word) ||
               names(s->way.transform, test->word);
    else if (test->transform)
        *yes = s->way.transform && strcmp(s->way.transform, test->transform) == 0;
    else if (test->pattern)
        return has_pattern(cx, s, test->pattern, yes);
    else if (smiles) {
        for (int i = 0; i < s->count; i++)
            *yes = *yes || strcmp(s->smiles[i], smiles) == 0;
    }
    return BS_OK;
}

/* Makes a subject, to be freed by its arena, also after a failure; `smiles` may have tags. */
static bs_status make_subject(const bs_plan_state *plan, bs_ctx *cx, uint32_t tag,
                              const char *const *smiles, int count, subject *s)
{
    bs_status st;

    bs_plan__fill_way(plan, tag, &s->way);
    s->count = count;
    bs_arena_init(&s->home, cx->gate);
    if ((st = bs_new(cx, &s->home, count, &s->smiles)) != BS_OK ||
        (st = bs_new(cx, &s->home, count, &s->mols)) != BS_OK)
        return st;
    for (int i = 0; st == BS_OK && i < count; i++)
        st = bs_tag__plain(cx, &s->home, &plan->con.tags, smiles[i], &s->smiles[i]);
    return st;
}

/* ---- Single steps ---------------------------------------------------------------------------- */

/* Reads the product of a step, unless it is the one looked at last. */
static bs_status look_at_product(bs_plan_state *plan, bs_ctx *cx, const char *product)
{
    bs_constraint *con = &plan->con;
    bs_status st;

    if (con->product && strcmp(con->product, product) == 0)
        return BS_OK;
    bs_arena_free(&con->product_home);
    con->product = NULL;
    st = bs_smiles_read(cx, &con->product_home, product, strlen(product), NULL, &con->product_mol);
    for (int i = 0; st == BS_OK && i < con->given->intact_count; i++) {
        bs_matches found;

        st = bs_pattern_find(cx, &con->product_home, con->given->intact[i], con->product_mol, NULL,
                             &found);
        con->intact[i] = found.count;
    }
    if (st == BS_OK) {
        char *copy;

        st = bs_copy_text(cx, &con->product_home, product, strlen(product), &copy);
        con->product = copy;
    }
    return st;
}

/* Whether the precursors have each pattern as often as the product: no step builds one. */
static bs_status stays_intact(bs_plan_state *plan, bs_ctx *cx, const bs_proposal *p, bool *good)
{
    const bs_constraints *given = plan->con.given;
    bs_status st = BS_OK;

    for (int i = 0; st == BS_OK && *good && i < given->intact_count; i++) {
        double had = 0;

        for (int k = 0; st == BS_OK && k < p->count && had < plan->con.intact[i]; k++) {
            bs_matches found = {0};
            bs_arena home;

            bs_arena_init(&home, cx->gate);
            st = bs_pattern_find(cx, &home, given->intact[i], p->mols[k], NULL, &found);
            had += found.count * fmax(1, p->equivalents[k]);
            bs_arena_free(&home);
        }
        *good = had >= plan->con.intact[i];
    }
    return st;
}

static bool is_bonded(const bs_proposal *p, const bs_tagged_bond *bond)
{
    for (int i = 0; i < p->count; i++) {
        if (bs_tag__bonded(p->mols[i], bond->a, bond->b))
            return true;
    }
    return false;
}

/*
 * Whether a step takes the product apart: a disconnection, or a known step that joins two or more
 * compounds with carbon.
 */
static bool takes_apart(const bs_plan_state *plan, const bs_proposal *p)
{
    int with_carbon = 0;

    if (!(p->tag & BS_PLAN_KNOWN))
        return bs_rules_transform(plan->opts->rules, (int)p->tag)->kind == BS_DISCONNECTION;
    for (int i = 0; i < p->count; i++) {
        bool carbon = false;

        for (int k = 0; k < bs_mol_atom_count(p->mols[i]); k++)
            carbon = carbon || bs_mol_atom_element(p->mols[i], k) == 6;
        with_carbon += carbon;
    }
    return with_carbon > 1;
}

/* What a step does with the marked bonds that its product still has. */
static bool heeds_bonds(const bs_plan_state *plan, const bs_proposal *p)
{
    const bs_constraint *con = &plan->con;

    for (int i = 0; i < con->bond_count; i++) {
        const bs_tagged_bond *bond = &con->bonds[i];
        bool kept;

        if (!bs_tag__bonded(con->product_mol, bond->a, bond->b))
            continue;
        kept = is_bonded(p, bond);
        if (bond->wish == BS_BOND_KEEP
                ? !kept
                : bond->wish == BS_BOND_FIRST && kept && takes_apart(plan, p))
            return false;
    }
    return true;
}

bs_status bs_constraint__admit(bs_plan_state *plan, bs_ctx *cx, const char *product,
                               const bs_proposal *p, bool *admitted)
{
    bs_constraint *con = &plan->con;
    bs_status st = BS_OK;

    if (!con->given)
        return BS_OK;
    if (con->given->avoid_count > 0) {
        subject s;

        st = make_subject(plan, cx, p->tag, p->smiles, p->count, &s);
        for (int i = 0; st == BS_OK && *admitted && i < con->given->avoid_count; i++) {
            bool met;

            st = meets(cx, &s, &con->given->avoid[i], con->avoid[i], &met);
            *admitted = !met;
        }
        bs_arena_free(&s.home);
    }
    if (st != BS_OK || !*admitted || con->given->intact_count + con->bond_count == 0)
        return st;
    if ((st = look_at_product(plan, cx, product)) == BS_OK)
        st = stays_intact(plan, cx, p, admitted);
    *admitted = *admitted && heeds_bonds(plan, p);
    return st;
}

void bs_constraint__offer(const bs_plan_state *plan, const bs_mol *mol, const char *smiles,
                          bool *may, bool *must)
{
    const bs_constraint *con = &plan->con;

    *may = true;
    *must = false;
    if (!con->given)
        return;
    for (int i = 0; i < con->given->not_bought_count; i++)
        *may = *may && strcmp(con->not_bought[i], smiles) != 0;
    for (int i = 0; i < con->bond_count; i++) {
        const bs_tagged_bond *bond = &con->bonds[i];

        if (bond->wish != BS_BOND_KEEP && bs_tag__bonded(mol, bond->a, bond->b))
            *may = false;
    }
    for (int i = 0; i < con->given->start_count; i++)
        *must = *must || strcmp(con->start[i], smiles) == 0;
}

/* ---- Whole routes ---------------------------------------------------------------------------- */

/* The tests that a way of the graph meets; found out once. */
static bs_status find_marks(bs_plan_state *plan, uint32_t w, uint64_t *marks)
{
    bs_ctx *cx = plan->cx;
    bs_constraint *con = &plan->con;
    const bs_graph *graph = &plan->x.graph;
    const bs_graph_way *way = &graph->ways[w];
    const bs_constraints *given = con->given;
    bs_mark temp = bs_arena_mark(&cx->scratch);
    const char **smiles;
    subject s;
    bool met;
    bs_status st;

    if ((st = bs_graph__reserve(cx, &con->marks, &con->marks_room, (size_t)w + 1,
                                sizeof *con->marks)) != BS_OK)
        return st;
    if (w >= con->marked_room) {
        size_t before = con->marked_room;

        st = bs_graph__reserve(cx, &con->marked, &con->marked_room, (size_t)w + 1,
                               sizeof *con->marked);
        if (st != BS_OK)
            return st;
        memset(con->marked + before, 0, (con->marked_room - before) * sizeof *con->marked);
    }
    *marks = con->marks[w];
    if (con->marked[w])
        return BS_OK;
    *marks = 0;
    if ((st = bs_new(cx, &cx->scratch, way->count, &smiles)) != BS_OK)
        return st;
    for (uint32_t i = 0; i < way->count; i++)
        smiles[i] = plan->x.nodes[graph->uses[way->first + i].mol].smiles;
    st = make_subject(plan, cx, way->tag, smiles, (int)way->count, &s);
    for (int i = 0; st == BS_OK && i < given->use_count + given->at_most_count; i++) {
        bool limit = i >= given->use_count;
        int k = limit ? i - given->use_count : i;

        st = meets(cx, &s, limit ? &given->at_most[k] : &given->use[k],
                   limit ? con->at_most[k] : con->use[k], &met);
        if (st == BS_OK && met)
            *marks |= (uint64_t)1 << i;
    }
    bs_arena_free(&s.home);
    bs_arena_rewind(&cx->scratch, temp);
    if (st == BS_OK) {
        con->marks[w] = *marks;
        con->marked[w] = true;
    }
    return st;
}

static bs_status judge_tests(bs_plan_state *plan, const bs_outline *o, bool *good)
{
    const bs_constraints *given = plan->con.given;
    uint64_t all = 0;
    int counts[MOST_TESTS] = {0};

    for (int i = 0; i < o->step_count; i++) {
        uint64_t marks;
        bs_status st = find_marks(plan, o->ways[i], &marks);

        if (st != BS_OK)
            return st;
        all |= marks;
        for (int k = 0; k < given->at_most_count; k++)
            counts[k] += (marks >> (given->use_count + k)) & 1;
    }
    for (int i = 0; i < given->use_count; i++)
        *good = *good && (all >> i) & 1;
    for (int k = 0; k < given->at_most_count; k++)
        *good = *good && counts[k] <= given->at_most[k].most;
    return BS_OK;
}

/* Each compound to start from must be among those that no step makes. */
static bool starts_right(const bs_plan_state *plan, const bs_outline *o)
{
    for (int i = 0; i < plan->con.given->start_count; i++) {
        bool found = false;

        for (int k = 0; k < o->molecule_count; k++)
            found = found || (o->molecules[k].step < 0 &&
                              strcmp(o->molecules[k].smiles, plan->con.start[i]) == 0);
        if (!found)
            return false;
    }
    return true;
}

/* ---- Protecting groups ------------------------------------------------------------------------
 */

static bool ends_with(const char *text, size_t length, const char *end, size_t *before)
{
    size_t n = strlen(end);

    if (length < n)
        return false;
    for (size_t i = 0; i < n; i++) {
        if (tolower((unsigned char)text[length - n + i]) != end[i])
            return false;
    }
    *before = length - n;
    while (*before > 0 && (text[*before - 1] == '-' || text[*before - 1] == ' '))
        --*before;
    return true;
}

/* 1 if a transform puts a protecting group on, -1 if it takes one off; `length` of its group's
 * name. */
static int protects(const char *name, size_t *length)
{
    size_t whole = name ? strlen(name) : 0;

    if (ends_with(name, whole, "removal", length) || ends_with(name, whole, "deprotection", length))
        return -1;
    return ends_with(name, whole, "protection", length) ? 1 : 0;
}

static const char *name_of(const bs_plan_state *plan, uint32_t way)
{
    bs_route_way out;

    bs_plan__fill_way(plan, plan->x.graph.ways[way].tag, &out);
    return out.transform;
}

/* Of this group, how many the target still carries: what was put on less what came off after. */
static bs_status count_left(const bs_plan_state *plan, const bs_outline *o, const char *group,
                            size_t length, int *left)
{
    bs_arena *scratch = &plan->cx->scratch;
    bs_mark temp = bs_arena_mark(scratch);
    int *on;
    bs_status st = bs_new(plan->cx, scratch, o->molecule_count, &on);

    if (st != BS_OK)
        return st;
    for (int i = 0; i < o->step_count; i++) {
        const bs_route_step *step = &o->steps[i];
        const char *name = name_of(plan, o->ways[i]);
        size_t other;
        int change = protects(name, &other), sum = 0;

        for (int k = 0; k < step->precursor_count; k++)
            sum += on[step->precursors[k]];
        if (change != 0 && other == length && strncasecmp(name, group, length) == 0)
            sum += change;
        on[step->product] = sum > 0 ? sum : 0;
    }
    *left = on[0];
    bs_arena_rewind(scratch, temp);
    return BS_OK;
}

static bs_status judge_protection(const bs_plan_state *plan, const bs_outline *o, bool *good)
{
    const bs_constraints *given = plan->con.given;
    int put_on = 0;
    bs_status st = BS_OK;

    for (int i = 0; st == BS_OK && *good && i < o->step_count; i++) {
        const char *name = name_of(plan, o->ways[i]);
        size_t length;
        int left = 0;

        if (protects(name, &length) <= 0)
            continue;
        put_on++;
        if (given->unprotect)
            st = count_left(plan, o, name, length, &left);
        *good = left == 0;
    }
    if (given->has_protections && put_on > given->protections)
        *good = false;
    return st;
}

bs_status bs_constraint__judge(bs_plan_state *plan, const bs_outline *o, bool *good)
{
    const bs_constraints *given = plan->con.given;
    bs_status st = BS_OK;

    *good = true;
    if (!given || !plan->con.whole)
        return BS_OK;
    /* A step outside of the longest line: two branches meet. */
    if (given->convergent && o->step_count <= o->longest)
        *good = false;
    if (*good)
        *good = starts_right(plan, o);
    if (*good && given->use_count + given->at_most_count > 0)
        st = judge_tests(plan, o, good);
    if (st == BS_OK && *good && (given->has_protections || given->unprotect))
        st = judge_protection(plan, o, good);
    return st;
}
