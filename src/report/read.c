/* Routes from JSON: the form of docs/routes.md, checked field by field. */
#include "backsaw/report.h"

#include "report/field.h"

#include <math.h>
#include <string.h>

#define MOST_BYTES ((size_t)256 << 20)

/* ---- A route --------------------------------------------------------------------------------- */

/* The parts of a route; they lie in `temp`. */
typedef struct parts {
    bs_route_molecule *molecules;
    bs_route_step *steps;
    int molecule_count, step_count;
} parts;

static bs_status read_offer(bs_reader *r, const json_t *object, bs_offer *offer)
{
    bs_status st;

    if (!json_is_object(object))
        return bs_field__refuse(r, BS_ESYNTAX, "an object is expected");
    if ((st = bs_field__text(r, &r->temp, object, "smiles", BS_FIELD_NEEDED, &offer->smiles)) !=
            BS_OK ||
        (st = bs_field__text(r, &r->temp, object, "code", BS_FIELD_OPTIONAL, &offer->code)) !=
            BS_OK ||
        (st = bs_field__text(r, &r->temp, object, "name", BS_FIELD_OPTIONAL, &offer->name)) !=
            BS_OK ||
        (st = bs_field__text(r, &r->temp, object, "ground", BS_FIELD_OPTIONAL, &offer->ground)) !=
            BS_OK ||
        (st = bs_field__number(r, object, "price_per_gram", BS_FIELD_OPTIONAL, 0,
                               &offer->price_per_gram)) ||
        (st = bs_field__number(r, object, "container_g", BS_FIELD_OPTIONAL, 0,
                               &offer->container_g)) != BS_OK)
        return st;
    return bs_field__number(r, object, "lead_days", BS_FIELD_OPTIONAL, 0, &offer->lead_days);
}

static bs_status read_molecule(bs_reader *r, const json_t *object, const parts *p,
                               bs_route_molecule *out)
{
    json_t *offer;
    bs_status st;

    *out = (bs_route_molecule){.price = -1,
                               .offer = {.price_per_gram = -1, .container_g = -1, .lead_days = -1}};
    if (!json_is_object(object))
        return bs_field__refuse(r, BS_ESYNTAX, "an object is expected");
    if ((st = bs_field__smiles(r, &r->temp, object, "smiles", BS_FIELD_NEEDED, &out->smiles)) !=
            BS_OK ||
        (st = bs_field__flag(r, object, "bought", BS_FIELD_NEEDED, &out->bought)) != BS_OK)
        return st;
    for (const bs_route_molecule *other = p->molecules; other < out; other++) {
        if (strcmp(other->smiles, out->smiles) == 0)
            return bs_field__refuse_in(r, "smiles", "this compound stands in the list already");
    }
    if (!out->bought)
        return BS_OK;
    if ((st = bs_field__number(r, object, "price", BS_FIELD_NEEDED, 0, &out->price)) != BS_OK ||
        (st = bs_field__get(r, object, "offer", BS_FIELD_OPTIONAL, &offer)) != BS_OK || !offer)
        return st;
    bs_field__enter(r, "offer", 0);
    st = read_offer(r, offer, &out->offer);
    bs_field__leave(r);
    return st;
}

static bs_status read_molecules(bs_reader *r, const json_t *route, parts *p)
{
    json_t *list;
    size_t count;
    bs_status st = bs_field__list(r, route, "molecules", BS_FIELD_NEEDED, &list);

    if (st != BS_OK)
        return st;
    if ((count = json_array_size(list)) > 100000)
        return bs_field__refuse_in(r, "molecules", "more than 100000 molecules");
    if ((st = bs_new(r->cx, &r->temp, count, &p->molecules)) != BS_OK)
        return st;
    bs_field__enter(r, "molecules", 0);
    for (size_t i = 0; st == BS_OK && i < count; i++) {
        bs_field__enter(r, NULL, i);
        st = read_molecule(r, json_array_get(list, i), p, &p->molecules[i]);
        bs_field__leave(r);
    }
    bs_field__leave(r);
    p->molecule_count = (int)count;
    return st;
}

/* The number of the compound that a SMILES names. */
static bs_status read_reference(bs_reader *r, const parts *p, const json_t *value, int *out)
{
    const char *smiles;
    bs_status st = bs_field__read_smiles(r, &r->temp, value, &smiles);

    for (*out = 0; st == BS_OK && *out < p->molecule_count; ++*out) {
        if (strcmp(p->molecules[*out].smiles, smiles) == 0)
            return BS_OK;
    }
    return st == BS_OK ? bs_field__refuse(r, BS_EVALUE, "this compound is not among the molecules")
                       : st;
}

static bs_status read_range(bs_reader *r, const json_t *object, bs_route_way *way)
{
    json_t *range;
    bs_status st = bs_field__list(r, object, "yield_range", BS_FIELD_OPTIONAL, &range);

    if (st != BS_OK || !range)
        return st;
    way->yield_low = json_number_value(json_array_get(range, 0));
    way->yield_high = json_number_value(json_array_get(range, 1));
    if (json_array_size(range) != 2 || !(way->yield_low > 0) ||
        !(way->yield_low <= way->yield_high) || !(way->yield_high <= 100))
        return bs_field__refuse_in(r, "yield_range",
                                   "two numbers above 0 and up to 100 are expected");
    return BS_OK;
}

static bs_status read_equivalents(bs_reader *r, const json_t *object, int precursors,
                                  bs_route_way *way)
{
    json_t *list;
    bs_status st = bs_field__list(r, object, "equivalents", BS_FIELD_NEEDED, &list);

    if (st != BS_OK || (st = bs_new(r->cx, &r->temp, precursors, &way->equivalents)) != BS_OK)
        return st;
    if (json_array_size(list) != (size_t)precursors)
        return bs_field__refuse_in(r, "equivalents", "one number for each precursor is expected");
    for (int i = 0; i < precursors; i++) {
        way->equivalents[i] = json_number_value(json_array_get(list, (size_t)i));
        if (!(way->equivalents[i] > 0))
            return bs_field__refuse_in(r, "equivalents", "numbers above 0 are expected");
    }
    return BS_OK;
}

static bs_status read_way(bs_reader *r, const json_t *object, int precursors, bs_route_way *way)
{
    const char **cautions = NULL, **reagents = NULL;
    bs_status st;

    *way = (bs_route_way){.rule = -1};
    if (!json_is_object(object))
        return bs_field__refuse(r, BS_ESYNTAX, "an object is expected");
    if ((st = bs_field__text(r, &r->temp, object, "transform", BS_FIELD_OPTIONAL,
                             &way->transform)) != BS_OK ||
        (st = bs_field__text(r, &r->temp, object, "pack", BS_FIELD_OPTIONAL, &way->pack)) !=
            BS_OK ||
        (st = bs_field__text(r, &r->temp, object, "conditions", BS_FIELD_OPTIONAL,
                             &way->conditions)) != BS_OK ||
        (st = bs_field__text(r, &r->temp, object, "recipe", BS_FIELD_OPTIONAL, &way->recipe)) !=
            BS_OK ||
        (st = bs_field__text(r, &r->temp, object, "source", BS_FIELD_OPTIONAL, &way->source)) !=
            BS_OK ||
        (st = bs_field__words(r, object, "cautions", &cautions, &way->cautions.count)) != BS_OK ||
        (st = bs_field__words(r, object, "reagents", &reagents, &way->reagents.count)) != BS_OK ||
        (st = bs_field__number(r, object, "cost", BS_FIELD_NEEDED, 0, &way->cost)) != BS_OK ||
        (st = bs_field__number(r, object, "yield", BS_FIELD_NEEDED, 1e-9, &way->yield)) != BS_OK ||
        (st = read_range(r, object, way)) != BS_OK)
        return st;
    way->cautions.items = cautions;
    way->reagents.items = reagents;
    if (way->yield > 100)
        return bs_field__refuse_in(r, "yield", "a number up to 100 is expected");
    return read_equivalents(r, object, precursors, way);
}

static bs_status read_ways(bs_reader *r, const json_t *object, bs_route_step *step)
{
    json_t *list;
    bs_status st = bs_field__list(r, object, "ways", BS_FIELD_NEEDED, &list);
    size_t count = json_array_size(list);

    if (st != BS_OK)
        return st;
    if (count < 1 || count > 10000)
        return bs_field__refuse_in(r, "ways", "from 1 to 10000 ways are expected");
    if ((st = bs_new(r->cx, &r->temp, count, &step->ways)) != BS_OK)
        return st;
    bs_field__enter(r, "ways", 0);
    for (size_t i = 0; st == BS_OK && i < count; i++) {
        bs_field__enter(r, NULL, i);
        st = read_way(r, json_array_get(list, i), step->precursor_count, &step->ways[i]);
        bs_field__leave(r);
    }
    bs_field__leave(r);
    step->way_count = (int)count;
    return st;
}

static bs_status read_precursors(bs_reader *r, const json_t *object, const parts *p,
                                 bs_route_step *step)
{
    json_t *list;
    bs_status st = bs_field__list(r, object, "precursors", BS_FIELD_NEEDED, &list);
    size_t count = json_array_size(list);

    if (st != BS_OK)
        return st;
    if (count < 1 || count > 1000)
        return bs_field__refuse_in(r, "precursors", "from 1 to 1000 precursors are expected");
    if ((st = bs_new(r->cx, &r->temp, count, &step->precursors)) != BS_OK)
        return st;
    bs_field__enter(r, "precursors", 0);
    for (size_t i = 0; st == BS_OK && i < count; i++) {
        bs_field__enter(r, NULL, i);
        st = read_reference(r, p, json_array_get(list, i), &step->precursors[i]);
        for (size_t j = 0; st == BS_OK && j < i; j++) {
            if (step->precursors[j] == step->precursors[i])
                st = bs_field__refuse(r, BS_EVALUE, "this precursor stands in the list already");
        }
        bs_field__leave(r);
    }
    bs_field__leave(r);
    step->precursor_count = (int)count;
    return st;
}

static bs_status read_step(bs_reader *r, const json_t *object, const parts *p, bs_route_step *step)
{
    const char **rivals = NULL, **clashes = NULL;
    json_t *product;
    bs_status st;

    *step = (bs_route_step){.product = -1};
    if (!json_is_object(object))
        return bs_field__refuse(r, BS_ESYNTAX, "an object is expected");
    if ((st = bs_field__get(r, object, "product", BS_FIELD_NEEDED, &product)) != BS_OK)
        return st;
    bs_field__enter(r, "product", 0);
    st = read_reference(r, p, product, &step->product);
    bs_field__leave(r);
    if (st != BS_OK || (st = read_precursors(r, object, p, step)) != BS_OK ||
        (st = bs_field__flag(r, object, "known", BS_FIELD_OPTIONAL, &step->known)) != BS_OK ||
        (st = bs_field__words(r, object, "rivals", &rivals, &step->rival_count)) != BS_OK ||
        (st = bs_field__words(r, object, "clashes", &clashes, &step->clash_count)) != BS_OK)
        return st;
    step->rivals = (char **)rivals;
    step->clashes = (char **)clashes;
    return read_ways(r, object, step);
}

static bs_status read_steps(bs_reader *r, const json_t *route, parts *p)
{
    json_t *list;
    bs_status st = bs_field__list(r, route, "steps", BS_FIELD_NEEDED, &list);
    size_t count = json_array_size(list);

    if (st != BS_OK || (st = bs_new(r->cx, &r->temp, count, &p->steps)) != BS_OK)
        return st;
    if (count > (size_t)p->molecule_count)
        return bs_field__refuse_in(r, "steps", "more steps than molecules");
    bs_field__enter(r, "steps", 0);
    for (size_t i = 0; st == BS_OK && i < count; i++) {
        bs_field__enter(r, NULL, i);
        st = read_step(r, json_array_get(list, i), p, &p->steps[i]);
        bs_field__leave(r);
    }
    bs_field__leave(r);
    p->step_count = (int)count;
    return st;
}

/* A molecule says whether it is bought, and a step says what it makes: they must agree. */
static bs_status check_makers(bs_reader *r, const parts *p)
{
    bs_status st = BS_OK;

    bs_field__enter(r, "molecules", 0);
    for (int i = 0; st == BS_OK && i < p->molecule_count; i++) {
        bool made = false;

        for (int j = 0; j < p->step_count; j++)
            made = made || p->steps[j].product == i;
        bs_field__enter(r, NULL, (size_t)i);
        if (made == p->molecules[i].bought)
            st = bs_field__refuse_in(r, "bought",
                                     made ? "a step makes it, so it is not bought"
                                          : "no step makes it, so it must be bought");
        bs_field__leave(r);
    }
    bs_field__leave(r);
    return st;
}

static bs_status read_mode(bs_reader *r, const json_t *route, bs_cost_mode *mode)
{
    const char *word;
    bs_status st = bs_field__text(r, &r->temp, route, "mode", BS_FIELD_NEEDED, &word);

    if (st != BS_OK)
        return st;
    *mode = strcmp(word, "additive") == 0 ? BS_COST_ADDITIVE : BS_COST_PER_MOLE;
    if (*mode == BS_COST_PER_MOLE && strcmp(word, "per mole") != 0)
        return bs_field__refuse_in(r, "mode", "\"per mole\" or \"additive\" is expected");
    return BS_OK;
}

static bs_status read_route(bs_reader *r, const json_t *object, bs_route **out)
{
    parts p = {0};
    json_t *name;
    bs_cost_mode mode;
    int target = 0;
    bs_status st;

    if (!json_is_object(object))
        return bs_field__refuse(r, BS_ESYNTAX, "an object is expected");
    if ((st = read_mode(r, object, &mode)) != BS_OK ||
        (st = read_molecules(r, object, &p)) != BS_OK ||
        (st = read_steps(r, object, &p)) != BS_OK || (st = check_makers(r, &p)) != BS_OK ||
        (st = bs_field__get(r, object, "target", BS_FIELD_NEEDED, &name)) != BS_OK)
        return st;
    bs_field__enter(r, "target", 0);
    st = read_reference(r, &p, name, &target);
    bs_field__leave(r);
    if (st == BS_OK) {
        st = bs_route_build(r->cx, r->home, mode, p.molecules, p.molecule_count, p.steps,
                            p.step_count, target, out);
        if (st == BS_EVALUE)
            st = bs_field__refuse(r, st, r->cx->error.message);
    }
    if (st == BS_OK)
        (*out)->rank = json_is_number(json_object_get(object, "rank"))
                           ? json_number_value(json_object_get(object, "rank"))
                           : (*out)->cost;
    return st == BS_OK ? bs_route_recheck(r->cx, *out, r->rules, r->hooks) : st;
}

/* ---- The list ---------------------------------------------------------------------------------
 */

static bs_status read_explored(bs_reader *r, const json_t *top, bs_routes *list)
{
    double molecules = 0, expanded = 0, steps = 0;
    json_t *object;
    bs_status st = bs_field__get(r, top, "explored", BS_FIELD_OPTIONAL, &object);

    if (st != BS_OK || !object)
        return st;
    if (!json_is_object(object))
        return bs_field__refuse_in(r, "explored", "an object is expected");
    bs_field__enter(r, "explored", 0);
    if ((st = bs_field__number(r, object, "molecules", BS_FIELD_OPTIONAL, 0, &molecules)) ==
            BS_OK &&
        (st = bs_field__number(r, object, "expanded", BS_FIELD_OPTIONAL, 0, &expanded)) == BS_OK)
        st = bs_field__number(r, object, "steps", BS_FIELD_OPTIONAL, 0, &steps);
    bs_field__leave(r);
    list->molecules = (long)fmin(molecules, 1e15);
    list->expanded = (long)fmin(expanded, 1e15);
    list->steps = (long)fmin(steps, 1e15);
    return st;
}

static bs_status read_gap(bs_reader *r, const json_t *object, bs_gap *gap)
{
    double opens = 0, steps = 0;
    bs_status st;

    if (!json_is_object(object))
        return bs_field__refuse(r, BS_ESYNTAX, "an object is expected");
    if ((st = bs_field__smiles(r, r->home, object, "smiles", BS_FIELD_NEEDED, &gap->smiles)) !=
            BS_OK ||
        (st = bs_field__number(r, object, "opens", BS_FIELD_OPTIONAL, 0, &opens)) != BS_OK ||
        (st = bs_field__number(r, object, "steps", BS_FIELD_OPTIONAL, 0, &steps)) != BS_OK)
        return st;
    gap->opens = (int)fmin(opens, 1e9);
    gap->steps = (int)fmin(steps, 1e9);
    return bs_field__flag(r, object, "opens_target", BS_FIELD_OPTIONAL, &gap->opens_target);
}

static bs_status read_pack(bs_reader *r, const json_t *object, bs_pack_name *pack)
{
    bs_status st;

    if (!json_is_object(object))
        return bs_field__refuse(r, BS_ESYNTAX, "an object is expected");
    st = bs_field__text(r, r->home, object, "name", BS_FIELD_NEEDED, &pack->name);
    return st == BS_OK
               ? bs_field__text(r, r->home, object, "version", BS_FIELD_OPTIONAL, &pack->version)
               : st;
}

/* The lists of the outermost object: gaps, packs, and last the routes. */
static bs_status read_lists(bs_reader *r, const json_t *top, bs_routes *list)
{
    json_t *gaps, *packs, *routes;
    bs_status st;

    if ((st = bs_field__list(r, top, "gaps", BS_FIELD_OPTIONAL, &gaps)) != BS_OK ||
        (st = bs_field__list(r, top, "packs", BS_FIELD_OPTIONAL, &packs)) != BS_OK ||
        (st = bs_field__list(r, top, "routes", BS_FIELD_NEEDED, &routes)) != BS_OK ||
        (st = bs_new(r->cx, r->home, json_array_size(gaps), &list->gaps)) != BS_OK ||
        (st = bs_new(r->cx, r->home, json_array_size(packs), &list->packs)) != BS_OK ||
        (st = bs_new(r->cx, r->home, json_array_size(routes), &list->items)) != BS_OK)
        return st;
    bs_field__enter(r, "gaps", 0);
    for (size_t i = 0; st == BS_OK && i < json_array_size(gaps); i++) {
        bs_field__enter(r, NULL, i);
        st = read_gap(r, json_array_get(gaps, i), &list->gaps[list->gap_count++]);
        bs_field__leave(r);
    }
    r->steps[r->depth - 1].key = "packs";
    for (size_t i = 0; st == BS_OK && i < json_array_size(packs); i++) {
        bs_field__enter(r, NULL, i);
        st = read_pack(r, json_array_get(packs, i), &list->packs[list->pack_count++]);
        bs_field__leave(r);
    }
    r->steps[r->depth - 1].key = "routes";
    for (size_t i = 0; st == BS_OK && i < json_array_size(routes); i++) {
        bs_arena_free(&r->temp);
        bs_field__enter(r, NULL, i);
        if ((st = bs_poll(r->cx)) == BS_OK)
            st = read_route(r, json_array_get(routes, i), &list->items[list->count]);
        list->count += st == BS_OK;
        bs_field__leave(r);
    }
    bs_field__leave(r);
    return st;
}

static bs_status read_warnings(bs_reader *r, const json_t *top, bs_routes *list)
{
    const char **words = NULL;
    int count = 0;
    bs_status st = bs_field__words(r, top, "warnings", &words, &count);

    if (st == BS_OK)
        st = bs_new(r->cx, r->home, count, &list->warnings);
    for (int i = 0; st == BS_OK && i < count; i++) {
        char *copy = NULL;

        st = bs_copy_text(r->cx, r->home, words[i], strlen(words[i]), &copy);
        list->warnings[i] = copy;
    }
    list->warning_count = st == BS_OK ? count : 0;
    return st;
}

static bs_status read_top(bs_reader *r, const json_t *top, bs_routes *list)
{
    const char *format;
    double version = 0;
    bs_status st;

    if (!json_is_object(top))
        return bs_field__refuse(r, BS_ESYNTAX, "a file of routes is expected, an object");
    if ((st = bs_field__text(r, &r->temp, top, "format", BS_FIELD_NEEDED, &format)) != BS_OK ||
        (st = bs_field__number(r, top, "version", BS_FIELD_NEEDED, 1, &version)) != BS_OK)
        return st;
    if (strcmp(format, "backsaw routes") != 0)
        return bs_field__refuse_in(r, "format", "\"backsaw routes\" is expected");
    if (version > BS_ROUTES_VERSION)
        return bs_field__refuse_in(r, "version",
                                   "written by a newer program; version 1 is expected");
    if ((st = bs_field__smiles(r, r->home, top, "target", BS_FIELD_OPTIONAL, &list->target)) !=
            BS_OK ||
        (st = bs_field__flag(r, top, "complete", BS_FIELD_OPTIONAL, &list->complete)) != BS_OK ||
        (st = bs_field__text(r, r->home, top, "reason", BS_FIELD_OPTIONAL, &list->reason)) !=
            BS_OK ||
        (st = read_warnings(r, top, list)) != BS_OK || (st = read_explored(r, top, list)) != BS_OK)
        return st;
    return read_lists(r, top, list);
}

static bs_status parse(bs_reader *r, json_t **out)
{
    json_error_t error;

    *out = json_loadb(r->text, r->length, JSON_REJECT_DUPLICATES | JSON_DECODE_INT_AS_REAL, &error);
    if (*out)
        return BS_OK;
    bs_fail(r->cx, BS_ESYNTAX, "%s: line %d: no JSON: %s", r->path, error.line, error.text);
    r->cx->error.line = error.line;
    return BS_ESYNTAX;
}

bs_status bs_routes_load(bs_ctx *cx, const char *path, const bs_rules *rules,
                         const bs_rule_hooks *hooks, bs_routes **out)
{
    bs_reader r = {.cx = cx, .path = path, .rules = rules, .hooks = hooks};
    bs_routes *list = NULL;
    json_t *top = NULL;
    bs_arena file;
    char *text;
    bs_status st;

    *out = NULL;
    bs_arena_init(&file, cx->gate);
    bs_arena_init(&r.temp, cx->gate);
    if ((st = bs_read_file(cx, &file, path, MOST_BYTES, &text, &r.length)) == BS_OK) {
        r.text = text;
        st = parse(&r, &top);
    }
    if (st == BS_OK && (st = bs_routes_pick(cx, NULL, 0, NULL, &list)) == BS_OK) {
        r.home = &list->arena;
        st = read_top(&r, top, list);
    }
    json_decref(top);
    bs_arena_free(&r.temp);
    bs_arena_free(&file);
    if (st != BS_OK)
        bs_routes_free(cx, list);
    else
        *out = list;
    return st;
}
