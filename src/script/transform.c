/*
 * Transforms in Lua, and what they give: steps backwards and product sets forwards. A transform
 * is known by its index in the rule book of the session, which never forgets one.
 */
#include "script/host.h"

#include <math.h>
#include <string.h>

#define TRANSFORM_TYPE "backsaw.transform"
#define STEP_TYPE "backsaw.step"

/* The rule book's index of the transform at `i`; -1 for nil or none if `all`. */
static int check_transform(lua_State *L, int i)
{
    const int *index = luaL_testudata(L, i, TRANSFORM_TYPE);

    if (!index)
        bsl_type_error(L, i, "transform");
    return *index;
}

static void push_transform(lua_State *L, int index)
{
    int *box = lua_newuserdatauv(L, sizeof *box, 0);

    *box = index;
    luaL_setmetatable(L, TRANSFORM_TYPE);
}

/* t = core.find_transform(name), or nil */
static int core_find_transform(lua_State *L)
{
    const char *name = luaL_checkstring(L, 1);
    int index = bs_rules_find(bsl_host_of(L)->session->rules, name);

    if (index < 0)
        return 0;
    push_transform(L, index);
    return 1;
}

/* t = core.nth_transform(index), 0-based, or nil */
static int core_nth_transform(lua_State *L)
{
    lua_Integer index = luaL_checkinteger(L, 1);

    if (index < 0 || index >= bs_rules_count(bsl_host_of(L)->session->rules))
        return 0;
    push_transform(L, (int)index);
    return 1;
}

/* index = core.transform_index(t), 0-based */
static int core_transform_index(lua_State *L)
{
    lua_pushinteger(L, check_transform(L, 1));
    return 1;
}

void bsl_push_number(lua_State *L, double value)
{
    if (value == floor(value) && fabs(value) < 1e15)
        lua_pushinteger(L, (lua_Integer)value);
    else
        lua_pushnumber(L, value);
}

void bsl_push_words(lua_State *L, const char *const *items, int count)
{
    lua_createtable(L, count, 0);
    for (int i = 0; i < count; i++) {
        lua_pushstring(L, items[i]);
        lua_rawseti(L, -2, i + 1);
    }
}

static void set_text(lua_State *L, const char *field, const char *text)
{
    if (!text)
        return;
    lua_pushstring(L, text);
    lua_setfield(L, -2, field);
}

static void set_pair(lua_State *L, const char *field, double low, double high)
{
    if (low == 0 && high == 0)
        return;
    lua_createtable(L, 2, 0);
    bsl_push_number(L, low);
    lua_rawseti(L, -2, 1);
    bsl_push_number(L, high);
    lua_rawseti(L, -2, 2);
    lua_setfield(L, -2, field);
}

static void set_number(lua_State *L, const char *field, double value)
{
    if (value == 0)
        return;
    bsl_push_number(L, value);
    lua_setfield(L, -2, field);
}

/* Sets what says where a disconnection cuts, and which functions a rule has. */
static void set_cut(lua_State *L, const bs_transform_def *def)
{
    set_pair(L, "cut", def->cut[0], def->cut[1]);
    set_number(L, "acceptor_map", def->acceptor_map);
    set_number(L, "donor_map", def->donor_map);
    set_number(L, "step_cost", def->step_cost);
    lua_pushboolean(L, def->hook_when >= 0);
    lua_setfield(L, -2, "when");
    lua_pushboolean(L, def->hook_prefer >= 0);
    lua_setfield(L, -2, "prefer");
}

/* table = core.describe(t): what its author wrote */
static int core_describe(lua_State *L)
{
    int index = check_transform(L, 1);
    const bs_transform_def *def = bs_rules_transform(bsl_host_of(L)->session->rules, index);

    lua_createtable(L, 0, 16);
    set_text(L, "name", def->name);
    set_text(L, "kind", def->kind == BS_DISCONNECTION ? "disconnection" : "interconversion");
    set_text(L, "target", def->target);
    set_text(L, "from", def->from);
    set_text(L, "acceptor", def->acceptor);
    set_text(L, "donor", def->donor);
    set_text(L, "conditions", def->conditions);
    set_text(L, "recipe", def->recipe);
    set_text(L, "source", def->source);
    set_text(L, "rxno", def->rxno);
    set_text(L, "pack", def->pack);
    set_text(L, "origin", def->origin);
    set_pair(L, "yield", def->yield_low, def->yield_high);
    set_cut(L, def);
    bsl_push_words(L, def->also.items, def->also.count);
    lua_setfield(L, -2, "also");
    bsl_push_words(L, def->cautions.items, def->cautions.count);
    lua_setfield(L, -2, "cautions");
    bsl_push_words(L, def->reagents.items, def->reagents.count);
    lua_setfield(L, -2, "reagents");
    bsl_push_words(L, def->spares.items, def->spares.count);
    lua_setfield(L, -2, "spares");
    bsl_push_words(L, def->also_attacks.items, def->also_attacks.count);
    lua_setfield(L, -2, "also_attacks");
    return 1;
}

/* name = tostring(t) */
static int transform_tostring(lua_State *L)
{
    int index = check_transform(L, 1);

    lua_pushstring(L, bs_rules_transform(bsl_host_of(L)->session->rules, index)->name);
    return 1;
}

static int transform_eq(lua_State *L)
{
    const int *a = luaL_testudata(L, 1, TRANSFORM_TYPE), *b = luaL_testudata(L, 2, TRANSFORM_TYPE);

    lua_pushboolean(L, a && b && *a == *b);
    return 1;
}

/* Sets the fields of a step that its transform knows. */
static void set_definition(lua_State *L, const bs_transform_def *def)
{
    set_text(L, "transform", def->name);
    set_text(L, "pack", def->pack);
    set_text(L, "conditions", def->conditions);
    set_text(L, "recipe", def->recipe);
    set_text(L, "source", def->source);
    set_pair(L, "yield", def->yield_low, def->yield_high);
    bsl_push_words(L, def->cautions.items, def->cautions.count);
    lua_setfield(L, -2, "cautions");
    bsl_push_words(L, def->reagents.items, def->reagents.count);
    lua_setfield(L, -2, "reagents");
}

/* The atom of a site with this map number, or -1. */
static int mapped_atom(const bs_site *site, int map)
{
    for (int i = 0; i < site->count; i++) {
        if (site->maps[i] == map)
            return (int)site->atoms[i];
    }
    return -1;
}

/* Sets the field polarity of a disconnection by synthons. */
static void set_polarity(lua_State *L, const bs_mol *mol, const bs_transform_def *def,
                         const bs_site *site)
{
    bs_ctx *cx = bsl_host_of(L)->cx;
    int acceptor = mapped_atom(site, def->acceptor_map);
    int donor = mapped_atom(site, def->donor_map);
    bs_pole ends[2];

    if (!def->cut[0] || acceptor < 0 || donor < 0)
        return;
    if (bs_polarity_of_end(cx, mol, acceptor, donor, true, &ends[0]) != BS_OK ||
        bs_polarity_of_end(cx, mol, donor, acceptor, false, &ends[1]) != BS_OK)
        bsl_raise(L, NULL, 0);
    bsl_push_poles(L, ends);
    lua_setfield(L, -2, "polarity");
}

void bsl_push_step(lua_State *L, int product, const bs_step *step)
{
    const bs_transform_def *def =
        bs_rules_transform(bsl_host_of(L)->session->rules, step->transform);

    luaL_checkstack(L, 8, "step");
    product = lua_absindex(L, product);
    lua_createtable(L, 0, 14);
    lua_pushvalue(L, product);
    lua_setfield(L, -2, "product");
    bsl_push_mols(L, step->precursors, step->smiles, step->precursor_count);
    lua_setfield(L, -2, "precursors");
    lua_createtable(L, step->precursor_count, 0);
    for (int i = 0; i < step->precursor_count; i++) {
        bsl_push_number(L, step->equivalents[i]);
        lua_rawseti(L, -2, i + 1);
    }
    lua_setfield(L, -2, "equivalents");
    bsl_set_clashes(L, step);
    lua_pushboolean(L, step->minor);
    lua_setfield(L, -2, "minor");
    set_definition(L, def);
    set_polarity(L, bsl_checkmol(L, product), def, &step->site);
    luaL_setmetatable(L, STEP_TYPE);
}

/* Whether the options { minor = true } at index `i` are there. */
static unsigned read_flags(lua_State *L, int i)
{
    unsigned flags = 0;

    if (lua_isnoneornil(L, i))
        return 0;
    luaL_checktype(L, i, LUA_TTABLE);
    lua_pushnil(L);
    while (lua_next(L, i)) {
        if (lua_type(L, -2) != LUA_TSTRING || strcmp(lua_tostring(L, -2), "minor") != 0)
            bsl_error(L, BS_EVALUE, "back: the only option is 'minor'");
        if (lua_type(L, -1) != LUA_TBOOLEAN)
            bsl_error(L, BS_EVALUE, "back: 'minor' must be true or false, not a %s",
                      luaL_typename(L, -1));
        flags = lua_toboolean(L, -1) ? BS_BACK_MINOR : 0;
        lua_pop(L, 1);
    }
    return flags;
}

/* Steps of one transform (or of all, with -1) on the molecule at index `i`; options behind it. */
static int push_back(lua_State *L, int transform, int i)
{
    unsigned flags = read_flags(L, i + 1);
    bsl_host *host = bsl_host_of(L);
    const bs_mol *mol = bsl_tomol(L, i);
    bs_rule_hooks hooks = bsl_session_hooks(host->session);
    bs_mark mark = bs_arena_mark(&host->results);
    bs_steps steps;

    if (bs_rules_back(host->cx, &host->results, host->session->rules, transform, mol, &hooks, flags,
                      &steps) != BS_OK)
        return bsl_raise_from(L, mark, NULL, 0);
    lua_createtable(L, steps.count, 0);
    for (int k = 0; k < steps.count; k++) {
        bsl_push_step(L, i, &steps.items[k]);
        lua_rawseti(L, -2, k + 1);
    }
    bs_arena_rewind(&host->results, mark);
    return 1;
}

/* Product sets of one transform (or of all) from the molecules from index `first` on. */
static int push_forth(lua_State *L, int transform, int first)
{
    bsl_host *host = bsl_host_of(L);
    bs_rules *rules = host->session->rules;
    bs_rule_hooks hooks = bsl_session_hooks(host->session);
    bs_mark mark = bs_arena_mark(&host->results);
    bs_product_sets sets;
    int count;
    const bs_mol **mols = bsl_collect_mols(L, first, &count);

    if (bs_rules_forth(host->cx, &host->results, rules, transform, mols, count, &hooks, &sets) !=
        BS_OK)
        return bsl_raise_from(L, mark, NULL, 0);
    luaL_checkstack(L, 8, "product sets");
    lua_createtable(L, sets.count, 0);
    for (int i = 0; i < sets.count; i++) {
        const bs_product_set *set = &sets.items[i];

        lua_createtable(L, 0, 5);
        bsl_push_mols(L, set->outcome.products, set->outcome.smiles, set->outcome.product_count);
        lua_setfield(L, -2, "products");
        lua_pushboolean(L, set->expected);
        lua_setfield(L, -2, "expected");
        lua_pushboolean(L, set->major);
        lua_setfield(L, -2, "major");
        set_text(L, "kind", bs_rival_word(set->outcome.kind));
        set_text(L, "transform", bs_rules_transform(rules, set->transform)->name);
        lua_rawseti(L, -2, i + 1);
    }
    bs_arena_rewind(&host->results, mark);
    return 1;
}

static bool same_precursors(const bs_step *step, const bs_outcome *wanted)
{
    bool same = step->precursor_count == wanted->product_count;

    for (int i = 0; i < step->precursor_count && same; i++)
        same = strcmp(step->smiles[i], wanted->smiles[i]) == 0;
    return same;
}

static void push_rivals(lua_State *L, const bs_outcomes *rivals, int from)
{
    for (int i = 0; i < rivals->count; i++) {
        const bs_outcome *rival = &rivals->items[i];

        bsl_push_mols(L, rival->products, rival->smiles, rival->product_count);
        set_text(L, "kind", bs_rival_word(rival->kind));
        lua_rawseti(L, -2, from + i + 1);
    }
}

/* Finds the step from the precursors once more, with its rivals, and what the product gives again.
 */
static bs_status find_rivals(bsl_host *host, int transform, const bs_mol *product,
                             const bs_outcome *from, bs_outcomes out[2])
{
    bs_rule_hooks hooks = bsl_session_hooks(host->session);
    bs_steps steps;
    bs_status st = bs_rules_back(host->cx, &host->results, host->session->rules, transform, product,
                                 &hooks, BS_BACK_MINOR | BS_BACK_KINDS, &steps);

    for (int i = 0; i < steps.count && st == BS_OK; i++) {
        if (same_precursors(&steps.items[i], from)) {
            out[0] = steps.items[i].rivals;
            break;
        }
    }
    if (st == BS_OK)
        st = bs_rules_again(host->cx, &host->results, host->session->rules, transform, product,
                            (const bs_mol *const *)from->products, from->product_count, &hooks,
                            &out[1]);
    return st;
}

/* rivals = core.rivals(t, product, precursor, ...): lists of molecules, each with its kind */
static int core_rivals(lua_State *L)
{
    bsl_host *host = bsl_host_of(L);
    bs_mark mark = bs_arena_mark(&host->results);
    int transform = check_transform(L, 1);
    const bs_mol *product = bsl_tomol(L, 2);
    bs_outcomes rivals[2] = {{NULL, 0}, {NULL, 0}};
    bs_outcome from = {0};
    const bs_mol **mols = bsl_collect_mols(L, 3, &from.product_count);
    bs_status st;

    from.products = (bs_mol **)mols;
    st = bs_new(host->cx, &host->results, from.product_count + 1, &from.smiles);
    for (int i = 0; i < from.product_count && st == BS_OK; i++)
        st = bs_smiles_canonical(host->cx, &host->results, mols[i], 0, &from.smiles[i]);
    if (st == BS_OK)
        st = find_rivals(host, transform, product, &from, rivals);
    if (st != BS_OK)
        return bsl_raise_from(L, mark, NULL, 0);
    luaL_checkstack(L, 8, "rivals");
    lua_createtable(L, rivals[0].count + rivals[1].count, 0);
    push_rivals(L, &rivals[0], 0);
    push_rivals(L, &rivals[1], rivals[0].count);
    bs_arena_rewind(&host->results, mark);
    return 1;
}

/* steps = t:back(m [, { minor = true }]) */
static int transform_back(lua_State *L)
{
    return push_back(L, check_transform(L, 1), 2);
}

/* sets = t:forth(m, ...) */
static int transform_forth(lua_State *L)
{
    int index = check_transform(L, 1);

    if (lua_gettop(L) < 2)
        return bsl_type_error(L, 2, "molecule or SMILES");
    return push_forth(L, index, 2);
}

/* steps = core.back(m [, { minor = true }]): of every transform in use */
static int core_back(lua_State *L)
{
    return push_back(L, -1, 1);
}

/* sets = core.forth(m, ...) */
static int core_forth(lua_State *L)
{
    if (lua_gettop(L) < 1)
        return bsl_type_error(L, 1, "molecule or SMILES");
    return push_forth(L, -1, 1);
}

void bsl_open_transform(lua_State *L)
{
    static const luaL_Reg methods[] = {
        {"back", transform_back},
        {"forth", transform_forth},
        {NULL, NULL},
    };
    static const luaL_Reg meta[] = {
        {"__tostring", transform_tostring},
        {"__eq", transform_eq},
        {NULL, NULL},
    };
    static const luaL_Reg functions[] = {
        {"find_transform", core_find_transform},
        {"nth_transform", core_nth_transform},
        {"transform_index", core_transform_index},
        {"describe", core_describe},
        {"back", core_back},
        {"forth", core_forth},
        {"rivals", core_rivals},
        {NULL, NULL},
    };

    bsl_new_type(L, TRANSFORM_TYPE, methods, meta);
    bsl_new_type(L, STEP_TYPE, NULL, NULL);
    luaL_setfuncs(L, functions, 0);
    luaL_getmetatable(L, TRANSFORM_TYPE);
    lua_setfield(L, -2, "transform_type");
    luaL_getmetatable(L, STEP_TYPE);
    lua_setfield(L, -2, "step_type");
}
