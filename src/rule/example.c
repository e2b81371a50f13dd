/* Drafting a transform from an example: trying patterns until one gives the example back. */
#include "rule/example.h"

#include <string.h>

#include "backsaw/format.h"
#include "backsaw/why.h"

typedef struct trial {
    bs_example *ex;
    bs_transform_def def;
    bs_mol **compounds; /* of the reactants, as one molecule each */
    bool backwards, forwards;
    char *reason; /* one line on what was in the way, or NULL */
} trial;

/* ---- Trying ------------------------------------------------------------------------------------
 */

static bool is_named(const bs_example *ex, const char *smiles)
{
    for (int i = 0; i < ex->precursor_count; i++) {
        if (strcmp(ex->precursors[i], smiles) == 0)
            return true;
    }
    return false;
}

/* Whether a step has the precursors of the example; both lists may name a compound twice. */
static bool same_precursors(const bs_example *ex, const bs_step *step)
{
    for (int i = 0; i < step->precursor_count; i++) {
        if (!is_named(ex, step->smiles[i]))
            return false;
    }
    for (int i = 0; i < ex->precursor_count; i++) {
        bool found = false;

        for (int k = 0; k < step->precursor_count && !found; k++)
            found = strcmp(ex->precursors[i], step->smiles[k]) == 0;
        if (!found)
            return false;
    }
    return true;
}

static bs_status try_back(trial *t, const bs_rules *rules)
{
    bs_example *ex = t->ex;
    bs_steps steps;
    bs_status st =
        bs_rules_back(ex->cx, ex->work, rules, 0, ex->product.pieces[0], NULL, 0, &steps);

    for (int i = 0; i < steps.count && st == BS_OK; i++)
        t->backwards = t->backwards || same_precursors(ex, &steps.items[i]);
    return st;
}

/* Forwards, the product comes first in a set that passes the tests of the target; stereo may be
 * open. */
static bs_status try_forth(trial *t, const bs_rules *rules)
{
    bs_example *ex = t->ex;
    bs_product_sets sets;
    bs_status st = bs_rules_forth(ex->cx, ex->work, rules, 0, (const bs_mol *const *)t->compounds,
                                  ex->precursor_count, NULL, &sets);

    for (int i = 0; i < sets.count && st == BS_OK; i++)
        t->forwards = t->forwards || sets.items[i].expected;
    return st;
}

static bs_status find_reason(trial *t, const bs_rules *rules)
{
    bs_reasons reasons;
    bs_status st =
        bs_rules_why(t->ex->cx, t->ex->work, rules, 0, t->ex->product.pieces[0], NULL, &reasons);

    t->reason = NULL;
    if (st == BS_OK && reasons.count > 0)
        t->reason = reasons.items[0].text;
    return st;
}

/* A rule that cannot be used is no failure of the drafting: its message is the reason. */
static bs_status forgive(trial *t, bs_status st)
{
    if (st != BS_ESYNTAX && st != BS_EVALUE && st != BS_ELIMIT && st != BS_ERANGE)
        return st;
    t->backwards = t->forwards = false;
    return bs_copy_text(t->ex->cx, t->ex->work, t->ex->cx->error.message,
                        strlen(t->ex->cx->error.message), &t->reason);
}

static bs_status try_detail(trial *t, const bs_example_detail *detail)
{
    bs_ctx *cx = t->ex->cx;
    char *target, *from;
    bs_rules *rules;
    int index;
    bs_status st = bs_example__patterns(t->ex, detail, &target, &from);

    t->backwards = t->forwards = false;
    if (st != BS_OK || (st = bs_rules_new(cx, &rules)) != BS_OK)
        return st;
    t->def.target = target;
    t->def.from = from;
    if ((st = bs_rules_add_transform(cx, rules, &t->def, &index)) == BS_OK &&
        (st = try_back(t, rules)) == BS_OK && (st = try_forth(t, rules)) == BS_OK && !t->backwards)
        st = find_reason(t, rules);
    bs_rules_free(rules);
    return forgive(t, st);
}

/* From what says least to what says most; the last resort says less than was asked for. */
static bs_status try_all(trial *t, int radius)
{
    const bs_example_detail details[] = {
        {radius, false, true},    {radius, false, false},    {radius, true, true},
        {radius, true, false},    {radius + 1, false, true}, {radius + 1, true, true},
        {radius + 3, true, true}, {0, false, true},          {BS_EXAMPLE_ATOMS, true, true},
        {radius, false, true},
    };
    bs_status st = BS_OK;

    for (size_t i = 0; i < sizeof details / sizeof *details && st == BS_OK; i++) {
        st = try_detail(t, &details[i]);
        if (t->backwards && t->forwards)
            break;
    }
    return st;
}

/* ---- Text --------------------------------------------------------------------------------------
 */

/* A string of Lua; SMARTS has no quotes, names may. */
static bs_status put_string(bs_text *out, const char *string)
{
    bs_status st = bs_text_putc(out, '"');

    for (const char *c = string; *c && st == BS_OK; c++) {
        if (*c == '"' || *c == '\\')
            st = bs_text_putc(out, '\\');
        if (st == BS_OK && (unsigned char)*c < 32)
            st = bs_text_printf(out, "\\%03d", *c);
        else if (st == BS_OK)
            st = bs_text_putc(out, *c);
    }
    return st == BS_OK ? bs_text_putc(out, '"') : st;
}

static bs_status put_strings(bs_text *out, char *const *strings, int count)
{
    bs_status st = bs_text_puts(out, "{ ");

    for (int i = 0; i < count && st == BS_OK; i++) {
        st = put_string(out, strings[i]);
        if (st == BS_OK)
            st = bs_text_puts(out, i + 1 < count ? ", " : " }");
    }
    return st;
}

static bs_status put_field(bs_text *out, const char *name, const char *value)
{
    bs_status st = bs_text_printf(out, "    %s = ", name);

    if (st == BS_OK)
        st = put_string(out, value);
    return st == BS_OK ? bs_text_puts(out, ",\n") : st;
}

static bs_status put_fields(const trial *t, bs_text *out)
{
    const bs_example *ex = t->ex;
    bs_status st;

    if ((st = put_field(out, "target", t->def.target)) != BS_OK ||
        (st = put_field(out, "from", t->def.from)) != BS_OK ||
        (st = bs_text_puts(
             out, "    -- conditions = \"...\", recipe = \"...\", yield = { 0, 0 },\n")) != BS_OK)
        return st;
    if (ex->agent_count > 0 && ((st = bs_text_puts(out, "    reagents = ")) != BS_OK ||
                                (st = put_strings(out, ex->agents, ex->agent_count)) != BS_OK ||
                                (st = bs_text_puts(out, ",\n")) != BS_OK))
        return st;
    if ((st = put_field(out, "source", "drafted from one example")) != BS_OK ||
        (st = bs_text_puts(out, "    example { ")) != BS_OK ||
        (st = put_string(out, ex->product_smiles)) != BS_OK ||
        (st = bs_text_puts(out, ", from = ")) != BS_OK ||
        (st = put_strings(out, ex->precursors, ex->precursor_count)) != BS_OK)
        return st;
    return bs_text_puts(out, " },\n}\n");
}

/* What a reader has to know: by-products, atoms without origin, and whether it works. */
static bs_status put_remarks(const trial *t, bs_text *out)
{
    const bs_example *ex = t->ex;
    int carbons = 0;
    bs_status st = BS_OK;

    for (int i = 0; i < ex->product.count; i++)
        carbons += ex->image[i] < 0 && ex->product.atoms[i].element == 6;
    if (ex->left_out)
        st = bs_text_printf(out, "-- left out of the products: %s\n", ex->left_out);
    if (st == BS_OK && carbons > 0)
        st = bs_text_printf(out, "-- %d carbon atom%s of the product %s in none of the reactants\n",
                            carbons, carbons == 1 ? "" : "s", carbons == 1 ? "is" : "are");
    if (st == BS_OK && !t->backwards)
        st = bs_text_printf(out, "-- it does not give its example backwards%s%s\n",
                            t->reason ? ": " : "", t->reason ? t->reason : "");
    if (st == BS_OK && !t->forwards)
        st = bs_text_puts(out, "-- it does not give its example forwards\n");
    return st;
}

static bs_status put_draft(const trial *t, bs_text *out)
{
    bs_status st =
        bs_text_puts(out, t->def.kind == BS_DISCONNECTION ? "disconnection " : "interconversion ");

    if (st == BS_OK)
        st = put_string(out, t->def.name);
    if (st == BS_OK)
        st = bs_text_puts(out, " {\n");
    if (st == BS_OK)
        st = put_fields(t, out);
    return st == BS_OK ? put_remarks(t, out) : st;
}

/* ---- All of it ---------------------------------------------------------------------------------
 */

/* A disconnection joins atoms of two reactants, or two atoms of one that were not bonded. */
static bs_transform_kind kind_of(const bs_example *ex)
{
    const bs_example_side *left = &ex->reactants, *right = &ex->product;

    for (int p = 0; p < right->count; p++) {
        for (int k = right->start[p]; k < right->start[p + 1]; k++) {
            int a = ex->image[p], b = ex->image[right->near[k]];

            if (a >= 0 && b >= 0 && !bs_example__bond(left, a, b))
                return BS_DISCONNECTION;
        }
    }
    return BS_INTERCONVERSION;
}

static bs_status make_compounds(trial *t)
{
    bs_example *ex = t->ex;
    bs_status st = bs_new(ex->cx, ex->work, ex->precursor_count + 1, &t->compounds);

    for (int i = 0; i < ex->precursor_count && st == BS_OK; i++)
        st = bs_smiles_read(ex->cx, ex->work, ex->precursors[i], strlen(ex->precursors[i]), NULL,
                            &t->compounds[i]);
    return st;
}

/* A reaction of which nothing can be learned. */
static bs_status check_change(const bs_example *ex)
{
    bool changes = false, kept = false;

    for (int i = 0; i < ex->product.count; i++) {
        changes = changes || ex->changes[i];
        kept = kept || ex->image[i] >= 0;
    }
    if (!kept)
        return bs_fail(ex->cx, BS_EVALUE, "no atom of the product comes from the reactants");
    if (!changes)
        return bs_fail(ex->cx, BS_EVALUE, "the reaction changes nothing");
    return BS_OK;
}

static bs_status make_draft(bs_example *ex, const char *text, size_t length,
                            const bs_example_opts *opts, bs_text *out, bool *works)
{
    trial t = {.ex = ex};
    bs_status st;

    if ((st = bs_example__read(ex, text, length)) != BS_OK || (st = bs_example__map(ex)) != BS_OK ||
        (st = check_change(ex)) != BS_OK || (st = make_compounds(&t)) != BS_OK)
        return st;
    t.def = (bs_transform_def){.name = opts && opts->name ? opts->name : "draft",
                               .kind = kind_of(ex),
                               .hook_when = -1,
                               .hook_prefer = -1};
    if ((st = try_all(&t, opts ? opts->radius : 1)) != BS_OK)
        return st;
    *works = t.backwards && t.forwards;
    return put_draft(&t, out);
}

bs_status bs_example_draft(bs_ctx *cx, bs_arena *home, const char *text, size_t length,
                           const bs_example_opts *opts, char **out, bool *works)
{
    bs_arena work;
    bs_text result;
    bs_example ex = {.cx = cx, .work = &work};
    bs_status st;

    *out = NULL;
    *works = false;
    bs_arena_init(&work, cx->gate);
    bs_text_init(&result, cx);
    st = make_draft(&ex, text, length, opts, &result, works);
    if (st == BS_OK)
        st = bs_copy_text(cx, home, result.data, result.length, out);
    bs_text_free(&result);
    bs_arena_free(&work);
    return st;
}
