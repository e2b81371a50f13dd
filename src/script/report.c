/* Routes in Lua that go into files and come out of them, are merged, or run again. */
#include "script/host.h"

#include <string.h>

/* Tells a list from which packs, of those in use, its steps come. */
static bs_status name_packs(bsl_host *host, bs_routes *routes)
{
    const bs_session *session = host->session;
    bs_mark mark = bs_arena_mark(&host->results);
    bs_pack_name *packs;
    int count = 0;
    bs_status st = bs_new(host->cx, &host->results, session->pack_count + 1, &packs);

    for (int i = 1; st == BS_OK && i < session->pack_count; i++) {
        const bsl_pack *pack = &session->pack_list[i];

        if (pack->done)
            packs[count++] = (bs_pack_name){ pack->name, pack->version };
    }
    if (st == BS_OK)
        st = bs_routes_set_packs(host->cx, routes, packs, count);
    bs_arena_rewind(&host->results, mark);
    return st;
}

bs_status bsl_name_packs(lua_State *L, bs_routes *routes)
{
    return name_packs(bsl_host_of(L), routes);
}

/* text = r:json() */
static int route_json(lua_State *L)
{
    const bs_route *route = bsl_checkroute(L, 1);
    bs_text text;

    bs_text_init(&text, bsl_host_of(L)->cx);
    if (bs_route_json(route, &text) != BS_OK) {
        bs_text_free(&text);
        return bsl_raise(L, NULL, 0);
    }
    return bsl_push_text(L, &text);
}

/* ok, step, text = r:verify(): runs the steps of rules again; on a failure its number and why */
static int route_verify(lua_State *L)
{
    const bs_route *route = bsl_checkroute(L, 1);
    bsl_host *host = bsl_host_of(L);
    bs_rule_hooks hooks = bsl_session_hooks(host->session);
    const char *transform;
    int failed;

    if (bs_route_verify(host->cx, route, host->session->rules, &hooks, &failed) != BS_OK)
        return bsl_raise(L, NULL, 0);
    lua_pushboolean(L, failed < 0);
    if (failed < 0)
        return 1;
    transform = route->steps[failed].ways[0].transform;
    lua_pushinteger(L, failed + 1);
    if (transform && bs_rules_find(host->session->rules, transform) >= 0)
        lua_pushfstring(L, "'%s' does not give this step", transform);
    else
        lua_pushfstring(L, "no transform named '%s' is in use", transform ? transform : "");
    return 3;
}

/* core.save_routes(rs, path) */
static int core_save_routes(lua_State *L)
{
    if (bs_routes_save(bsl_host_of(L)->cx, bsl_checkroutes(L, 1), luaL_checkstring(L, 2)) != BS_OK)
        return bsl_raise(L, NULL, 0);
    return 0;
}

/* rs = core.load_routes(path) */
static int core_load_routes(lua_State *L)
{
    bsl_host *host = bsl_host_of(L);
    bs_rule_hooks hooks = bsl_session_hooks(host->session);
    const char *path = luaL_checkstring(L, 1);
    bs_routes *routes;

    if (bs_routes_load(host->cx, path, host->session->rules, &hooks, &routes) != BS_OK) {
        host->cx->error.offset = -1; /* the message has the place */
        return bsl_raise(L, NULL, 0);
    }
    bsl_push_routes(L, routes);
    return 1;
}

/* rs = rs:merge(others) */
static int routes_merge(lua_State *L)
{
    const bs_routes *a = bsl_checkroutes(L, 1), *b = bsl_checkroutes(L, 2);
    bs_routes *merged;

    if (bs_routes_merge(bsl_host_of(L)->cx, a, b, &merged) != BS_OK)
        return bsl_raise(L, NULL, 0);
    bsl_push_routes(L, merged);
    return 1;
}

/* list = core.route_packs(rs): each with name and version */
static int core_route_packs(lua_State *L)
{
    const bs_routes *routes = bsl_checkroutes(L, 1);

    lua_createtable(L, routes->pack_count, 0);
    for (int i = 0; i < routes->pack_count; i++) {
        lua_createtable(L, 0, 2);
        lua_pushstring(L, routes->packs[i].name);
        lua_setfield(L, -2, "name");
        lua_pushstring(L, routes->packs[i].version);
        lua_setfield(L, -2, "version");
        lua_rawseti(L, -2, i + 1);
    }
    return 1;
}

void bsl_open_report(lua_State *L)
{
    static const luaL_Reg route[] = { { "json", route_json },
                                      { "verify", route_verify },
                                      { NULL, NULL } };
    static const luaL_Reg list[] = { { "merge", routes_merge }, { NULL, NULL } };
    static const luaL_Reg core[] = { { "save_routes", core_save_routes },
                                     { "load_routes", core_load_routes },
                                     { "route_packs", core_route_packs },
                                     { NULL, NULL } };

    lua_getfield(L, -1, "route_methods");
    luaL_setfuncs(L, route, 0);
    lua_getfield(L, -2, "routes_methods");
    luaL_setfuncs(L, list, 0);
    lua_pop(L, 2);
    luaL_setfuncs(L, core, 0);
}
