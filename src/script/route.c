/*
 * Routes and lists of routes in Lua. A list owns what the search gave; a route value owns a copy
 * of its own, so either may outlive the other. Both are boxed first and filled after.
 */
#include "script/host.h"

#include <string.h>

#define ROUTES_TYPE "backsaw.routes"
#define ROUTE_TYPE "backsaw.route"
#define STEP_TYPE "backsaw.step"

typedef struct routes_box {
    bs_routes *routes; /* NULL once freed */
} routes_box;

typedef struct route_box {
    bs_arena arena;
    bs_route *route; /* NULL once freed */
} route_box;

bs_routes *bsl_checkroutes(lua_State *L, int i)
{
    routes_box *box = luaL_testudata(L, i, ROUTES_TYPE);

    if (!box)
        bsl_type_error(L, i, "list of routes");
    if (!box->routes)
        bsl_error(L, BS_EVALUE, "the list of routes is closed");
    return box->routes;
}

bs_route *bsl_checkroute(lua_State *L, int i)
{
    route_box *box = luaL_testudata(L, i, ROUTE_TYPE);

    if (!box)
        bsl_type_error(L, i, "route");
    if (!box->route)
        bsl_error(L, BS_EVALUE, "the route is closed");
    return box->route;
}

/* The protected part of making a list's value. */
static int new_routes_box(lua_State *L)
{
    routes_box *box = lua_newuserdatauv(L, sizeof *box, 2); /* route values, the search */

    box->routes = NULL;
    lua_newtable(L);
    lua_setiuservalue(L, -2, 1);
    luaL_setmetatable(L, ROUTES_TYPE);
    return 1;
}

void bsl_push_routes(lua_State *L, bs_routes *routes)
{
    lua_pushcfunction(L, new_routes_box);
    if (lua_pcall(L, 0, 1, 0) != LUA_OK) {
        bs_routes_free(bsl_host_of(L)->cx, routes);
        lua_error(L);
    }
    ((routes_box *)lua_touserdata(L, -1))->routes = routes;
}

void bsl_push_route(lua_State *L, const bs_route *route)
{
    bsl_host *host = bsl_host_of(L);
    route_box *box = lua_newuserdatauv(L, sizeof *box, 0);

    box->route = NULL;
    bs_arena_init(&box->arena, host->session->cx.gate);
    luaL_setmetatable(L, ROUTE_TYPE);
    if (bs_route_copy(host->cx, &box->arena, route, &box->route) != BS_OK) {
        box->route = NULL;
        bsl_raise(L, NULL, 0);
    }
}

static int routes_gc(lua_State *L)
{
    routes_box *box = luaL_checkudata(L, 1, ROUTES_TYPE);

    bs_routes_free(bsl_host_of(L)->cx, box->routes);
    box->routes = NULL;
    return 0;
}

static int route_gc(lua_State *L)
{
    route_box *box = luaL_checkudata(L, 1, ROUTE_TYPE);

    box->route = NULL;
    bs_arena_free(&box->arena);
    return 0;
}

/* ---- Steps ----------------------------------------------------------------------------- */

static void set_text(lua_State *L, const char *field, const char *text)
{
    if (!text)
        return;
    lua_pushstring(L, text);
    lua_setfield(L, -2, field);
}

static void set_number(lua_State *L, const char *field, double value)
{
    lua_pushnumber(L, value);
    lua_setfield(L, -2, field);
}

/*
 * Sets what one way to run a step says in the table at the top. The yield of a known step is a
 * number; it stands as a range of its own.
 */
static void set_way(lua_State *L, const bs_route_way *way, int precursors)
{
    bool range = way->yield_low > 0 || way->yield_high > 0;

    set_text(L, "transform", way->transform);
    set_text(L, "pack", way->pack);
    set_text(L, "conditions", way->conditions);
    set_text(L, "recipe", way->recipe);
    set_text(L, "source", way->source);
    bsl_push_words(L, way->cautions.items, way->cautions.count);
    lua_setfield(L, -2, "cautions");
    bsl_push_words(L, way->reagents.items, way->reagents.count);
    lua_setfield(L, -2, "reagents");
    set_number(L, "cost", way->cost);
    if (range || way->rule < 0) {
        lua_createtable(L, 2, 0);
        bsl_push_number(L, range ? way->yield_low : way->yield);
        lua_rawseti(L, -2, 1);
        bsl_push_number(L, range ? way->yield_high : way->yield);
        lua_rawseti(L, -2, 2);
        lua_setfield(L, -2, "yield");
    }
    lua_createtable(L, precursors, 0);
    for (int i = 0; i < precursors; i++) {
        bsl_push_number(L, way->equivalents ? way->equivalents[i] : 1);
        lua_rawseti(L, -2, i + 1);
    }
    lua_setfield(L, -2, "equivalents");
}

/*
 * The molecules of a step stand in the table as text under the key `core`, until the embedded
 * module `step` is asked for product, precursors or rivals.
 */
static void set_molecules(lua_State *L, const bs_route *route, const bs_route_step *step)
{
    lua_getfield(L, LUA_REGISTRYINDEX, "backsaw.core");
    lua_createtable(L, 0, 3);
    set_text(L, "product", route->molecules[step->product].smiles);
    lua_createtable(L, step->precursor_count, 0);
    for (int i = 0; i < step->precursor_count; i++) {
        lua_pushstring(L, route->molecules[step->precursors[i]].smiles);
        lua_rawseti(L, -2, i + 1);
    }
    lua_setfield(L, -2, "precursors");
    bsl_push_words(L, (const char *const *)step->rivals, step->rival_count);
    lua_setfield(L, -2, "rivals");
    lua_rawset(L, -3);
}

void bsl_push_route_step(lua_State *L, const bs_route *route, int index)
{
    const bs_route_step *step = &route->steps[index];

    luaL_checkstack(L, 10, "step");
    lua_createtable(L, 0, 16);
    set_way(L, &step->ways[0], step->precursor_count);
    lua_createtable(L, step->way_count, 0);
    for (int i = 0; i < step->way_count; i++) {
        lua_createtable(L, 0, 10);
        set_way(L, &step->ways[i], step->precursor_count);
        lua_rawseti(L, -2, i + 1);
    }
    lua_setfield(L, -2, "ways");
    lua_pushboolean(L, step->known);
    lua_setfield(L, -2, "known");
    lua_pushboolean(L, step->checked);
    lua_setfield(L, -2, "checked");
    set_molecules(L, route, step);
    luaL_setmetatable(L, STEP_TYPE);
}

/* ---- A route --------------------------------------------------------------------------- */

/* list = r:steps(), in the order of the bench */
static int route_steps(lua_State *L)
{
    const bs_route *route = bsl_checkroute(L, 1);

    lua_createtable(L, route->step_count, 0);
    for (int i = 0; i < route->step_count; i++) {
        bsl_push_route_step(L, route, i);
        lua_rawseti(L, -2, i + 1);
    }
    return 1;
}

/* list = r:leaves(): what is bought; each has molecule, price (a mole), moles, offer */
static int route_leaves(lua_State *L)
{
    const bs_route *route = bsl_checkroute(L, 1);
    int n = 0;

    lua_newtable(L);
    for (int i = 0; i < route->molecule_count; i++) {
        const bs_route_molecule *leaf = &route->molecules[i];

        if (!leaf->bought)
            continue;
        lua_createtable(L, 0, 4);
        lua_pushstring(L, leaf->smiles);
        bsl_tomol(L, -1);
        lua_setfield(L, -2, "molecule");
        set_number(L, "price", leaf->price);
        set_number(L, "moles", leaf->moles);
        if (leaf->offer.smiles) {
            bsl_push_offer(L, &leaf->offer);
            lua_setfield(L, -2, "offer");
        }
        lua_getfield(L, LUA_REGISTRYINDEX, "backsaw.core");
        lua_getfield(L, -1, "leaf_type");
        lua_remove(L, -2);
        lua_setmetatable(L, -2);
        lua_rawseti(L, -2, ++n);
    }
    return 1;
}

/* table = r:measure() */
static int route_measure(lua_State *L)
{
    bs_route_measures m;

    bs_route_measure(bsl_checkroute(L, 1), &m);
    lua_createtable(L, 0, 9);
    lua_pushinteger(L, m.steps);
    lua_setfield(L, -2, "steps");
    bsl_push_number(L, m.runs);
    lua_setfield(L, -2, "runs");
    lua_pushinteger(L, m.longest);
    lua_setfield(L, -2, "longest");
    lua_pushinteger(L, m.leaves);
    lua_setfield(L, -2, "leaves");
    set_number(L, "cost", m.cost);
    set_number(L, "yield_low", m.yield_low);
    set_number(L, "yield", m.yield);
    set_number(L, "yield_high", m.yield_high);
    lua_pushboolean(L, m.checked);
    lua_setfield(L, -2, "checked");
    return 1;
}

/* text = tostring(r): the indented tree */
static int route_tostring(lua_State *L)
{
    const bs_route *route = bsl_checkroute(L, 1);
    bs_text text;

    bs_text_init(&text, bsl_host_of(L)->cx);
    if (bs_route_text(route, &text) != BS_OK) {
        bs_text_free(&text);
        return bsl_raise(L, NULL, 0);
    }
    while (text.length > 0 && text.data[text.length - 1] == '\n')
        text.length--;
    return bsl_push_text(L, &text);
}

static int route_eq(lua_State *L)
{
    const route_box *a = luaL_testudata(L, 1, ROUTE_TYPE), *b = luaL_testudata(L, 2, ROUTE_TYPE);

    lua_pushboolean(L, a && b && a->route && b->route && bs_route_same(a->route, b->route));
    return 1;
}

/* r.cost, r.rank, r.target; else a method */
static int route_index(lua_State *L)
{
    const bs_route *route = bsl_checkroute(L, 1);
    const char *key = lua_type(L, 2) == LUA_TSTRING ? lua_tostring(L, 2) : "";

    if (strcmp(key, "cost") == 0) {
        lua_pushnumber(L, route->cost);
    } else if (strcmp(key, "rank") == 0) {
        lua_pushnumber(L, route->rank);
    } else if (strcmp(key, "target") == 0) {
        lua_pushstring(L, route->molecules[0].smiles);
        bsl_tomol(L, -1);
    } else {
        lua_pushvalue(L, 2);
        lua_rawget(L, lua_upvalueindex(1));
    }
    return 1;
}

/* ---- A list ---------------------------------------------------------------------------- */

/* n = #rs */
static int routes_len(lua_State *L)
{
    lua_pushinteger(L, bsl_checkroutes(L, 1)->count);
    return 1;
}

/* Pushes the i-th route (0-based) of the list at index 1; the list remembers its value. */
static void push_nth(lua_State *L, const bs_routes *routes, int i)
{
    lua_getiuservalue(L, 1, 1);
    if (lua_rawgeti(L, -1, i + 1) == LUA_TNIL) {
        lua_pop(L, 1);
        bsl_push_route(L, routes->items[i]);
        lua_pushvalue(L, -1);
        lua_rawseti(L, -3, i + 1);
    }
    lua_remove(L, -2);
}

/* rs[i], rs.complete, rs.reason, rs.warnings, rs.target, rs.explored; else a method */
static int routes_index(lua_State *L)
{
    const bs_routes *routes = bsl_checkroutes(L, 1);
    const char *key = lua_type(L, 2) == LUA_TSTRING ? lua_tostring(L, 2) : "";
    lua_Integer i;

    if (lua_isinteger(L, 2)) {
        i = lua_tointeger(L, 2);
        if (i >= 1 && i <= routes->count)
            push_nth(L, routes, (int)i - 1);
        else
            lua_pushnil(L);
    } else if (strcmp(key, "complete") == 0) {
        lua_pushboolean(L, routes->complete);
    } else if (strcmp(key, "reason") == 0) {
        lua_pushstring(L, routes->reason);
    } else if (strcmp(key, "warnings") == 0) {
        lua_createtable(L, routes->warning_count, 0);
        for (int k = 0; k < routes->warning_count; k++) {
            lua_pushstring(L, routes->warnings[k]);
            lua_rawseti(L, -2, k + 1);
        }
    } else if (strcmp(key, "target") == 0) {
        lua_pushstring(L, routes->target);
        if (routes->target)
            bsl_tomol(L, -1);
    } else if (strcmp(key, "explored") == 0) {
        lua_createtable(L, 0, 3);
        set_number(L, "molecules", (double)routes->molecules);
        set_number(L, "expanded", (double)routes->expanded);
        set_number(L, "steps", (double)routes->steps);
    } else {
        lua_pushvalue(L, 2);
        lua_rawget(L, lua_upvalueindex(1));
    }
    return 1;
}

/* text = tostring(rs): a table, one line a route */
static int routes_tostring(lua_State *L)
{
    const bs_routes *routes = bsl_checkroutes(L, 1);
    bs_text text;

    bs_text_init(&text, bsl_host_of(L)->cx);
    if (bs_routes_table(routes, &text) != BS_OK) {
        bs_text_free(&text);
        return bsl_raise(L, NULL, 0);
    }
    while (text.length > 0 && text.data[text.length - 1] == '\n')
        text.length--;
    return bsl_push_text(L, &text);
}

/* list = rs:gaps(): each with molecule, opens, opens_target, steps */
static int routes_gaps(lua_State *L)
{
    const bs_routes *routes = bsl_checkroutes(L, 1);

    lua_createtable(L, routes->gap_count, 0);
    for (int i = 0; i < routes->gap_count; i++) {
        const bs_gap *gap = &routes->gaps[i];

        lua_createtable(L, 0, 4);
        lua_pushstring(L, gap->smiles);
        bsl_tomol(L, -1);
        lua_setfield(L, -2, "molecule");
        lua_pushinteger(L, gap->opens);
        lua_setfield(L, -2, "opens");
        lua_pushboolean(L, gap->opens_target);
        lua_setfield(L, -2, "opens_target");
        lua_pushinteger(L, gap->steps);
        lua_setfield(L, -2, "steps");
        lua_rawseti(L, -2, i + 1);
    }
    return 1;
}

/* rs = core.pick_routes(list of routes, like): a new list in the order given */
static int core_pick_routes(lua_State *L)
{
    bsl_host *host = bsl_host_of(L);
    const bs_routes *like = bsl_checkroutes(L, 2);
    bs_mark mark = bs_arena_mark(&host->results);
    const bs_route **items;
    bs_routes *picked;
    int count;
    bs_status st;

    luaL_checktype(L, 1, LUA_TTABLE);
    count = (int)lua_rawlen(L, 1);
    if (bs_new(host->cx, &host->results, count + 1, &items) != BS_OK)
        return bsl_raise_from(L, mark, NULL, 0);
    for (int i = 0; i < count; i++) {
        lua_rawgeti(L, 1, i + 1);
        items[i] = bsl_checkroute(L, -1);
        lua_pop(L, 1);
    }
    st = bs_routes_pick(host->cx, items, count, like, &picked);
    bs_arena_rewind(&host->results, mark);
    if (st != BS_OK)
        return bsl_raise(L, NULL, 0);
    bsl_push_routes(L, picked);
    lua_getiuservalue(L, 2, 2);
    lua_setiuservalue(L, -2, 2);
    return 1;
}

static int core_is_route(lua_State *L)
{
    lua_pushboolean(L, luaL_testudata(L, 1, ROUTE_TYPE) != NULL);
    return 1;
}

/* Makes a type whose __index is `index` with the table of methods as upvalue; the methods also
   stand in the private table under `name`, for the embedded modules to add to. */
static void indexed_type(lua_State *L, const char *type, const char *name, lua_CFunction index,
                         const luaL_Reg *methods, const luaL_Reg *meta)
{
    bsl_new_type(L, type, NULL, meta);
    luaL_getmetatable(L, type);
    lua_newtable(L);
    luaL_setfuncs(L, methods, 0);
    lua_pushvalue(L, -1);
    lua_setfield(L, -4, name);
    lua_pushcclosure(L, index, 1);
    lua_setfield(L, -2, "__index");
    lua_pop(L, 1);
}

void bsl_open_route(lua_State *L)
{
    static const luaL_Reg methods[] = {
        { "steps", route_steps },
        { "leaves", route_leaves },
        { "measure", route_measure },
        { NULL, NULL },
    };
    static const luaL_Reg meta[] = {
        { "__tostring", route_tostring },
        { "__eq", route_eq },
        { "__gc", route_gc },
        { NULL, NULL },
    };
    static const luaL_Reg list_methods[] = { { "gaps", routes_gaps }, { NULL, NULL } };
    static const luaL_Reg list_meta[] = {
        { "__len", routes_len },
        { "__tostring", routes_tostring },
        { "__gc", routes_gc },
        { NULL, NULL },
    };

    indexed_type(L, ROUTE_TYPE, "route_methods", route_index, methods, meta);
    indexed_type(L, ROUTES_TYPE, "routes_methods", routes_index, list_methods, list_meta);
    lua_pushcfunction(L, core_pick_routes);
    lua_setfield(L, -2, "pick_routes");
    lua_pushcfunction(L, core_is_route);
    lua_setfield(L, -2, "is_route");
}
