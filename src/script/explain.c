/* What a list of routes knows of its search, for the embedded module `explain`. */
#include "script/host.h"

#include <string.h>

static void set_number(lua_State *L, const char *field, double value)
{
    if (value < 0)
        return;
    bsl_push_number(L, value);
    lua_setfield(L, -2, field);
}

static void set_flag(lua_State *L, const char *field, bool value)
{
    lua_pushboolean(L, value);
    lua_setfield(L, -2, field);
}

static void push_note(lua_State *L, const bs_explored_molecule *note)
{
    lua_createtable(L, 0, 12);
    lua_pushstring(L, note->smiles);
    lua_setfield(L, -2, "smiles");
    lua_pushstring(L, note->lacks);
    lua_setfield(L, -2, "lacks");
    set_number(L, "price", note->price);
    set_number(L, "cost", note->cost);
    set_number(L, "depth", note->depth);
    set_number(L, "found", (double)note->found);
    set_number(L, "barred", (double)note->barred);
    set_number(L, "disallowed", (double)note->disallowed);
    set_flag(L, "expanded", note->expanded);
    set_flag(L, "closed", note->closed);
    set_flag(L, "too_deep", note->too_deep);
    set_flag(L, "ways", note->ways);
}

/* note = core.route_note(rs, smiles), or nil */
static int core_route_note(lua_State *L)
{
    const bs_routes *routes = bsl_checkroutes(L, 1);
    const bs_explored_molecule *note = bs_explored_find(routes->saw, luaL_checkstring(L, 2));

    if (note)
        push_note(L, note);
    else
        lua_pushnil(L);
    return 1;
}

/* yes = core.has_notes(rs) */
static int core_has_notes(lua_State *L)
{
    lua_pushboolean(L, bsl_checkroutes(L, 1)->saw != NULL);
    return 1;
}

/* list = core.unsolved_notes(rs) */
static int core_unsolved_notes(lua_State *L)
{
    const bs_explored *saw = bsl_checkroutes(L, 1)->saw;
    int n = 0;

    lua_newtable(L);
    for (long i = 0; saw && i < saw->molecule_count; i++) {
        if (saw->molecules[i].cost >= 0)
            continue;
        push_note(L, &saw->molecules[i]);
        lua_rawseti(L, -2, ++n);
    }
    return 1;
}

/* list = rs:transforms(): those of which steps were tried; transform tried found refused used fault
 */
static int core_route_transforms(lua_State *L)
{
    const bs_explored *saw = bsl_checkroutes(L, 1)->saw;
    int n = 0;

    lua_newtable(L);
    for (int i = 0; saw && i < saw->transform_count; i++) {
        const bs_transform_count *count = &saw->transforms[i];

        if (count->tried == 0 && count->found == 0 && !count->fault)
            continue;
        lua_createtable(L, 0, 6);
        lua_pushstring(L, count->name);
        lua_setfield(L, -2, "transform");
        set_number(L, "tried", (double)count->tried);
        set_number(L, "found", (double)count->found);
        set_number(L, "refused", (double)count->refused);
        set_number(L, "used", (double)count->used);
        lua_pushstring(L, count->fault);
        lua_setfield(L, -2, "fault");
        lua_rawseti(L, -2, ++n);
    }
    return 1;
}

/* "made", "bought" or nil = core.route_role(r, smiles) */
static int core_route_role(lua_State *L)
{
    const bs_route *route = bsl_checkroute(L, 1);
    const char *smiles = luaL_checkstring(L, 2);

    for (int i = 0; i < route->molecule_count; i++) {
        if (strcmp(route->molecules[i].smiles, smiles) == 0) {
            lua_pushstring(L, route->molecules[i].bought ? "bought" : "made");
            return 1;
        }
    }
    return 0;
}

void bsl_open_explain(lua_State *L)
{
    static const luaL_Reg core[] = { { "route_note", core_route_note },
                                     { "has_notes", core_has_notes },
                                     { "unsolved_notes", core_unsolved_notes },
                                     { "route_transforms", core_route_transforms },
                                     { "route_role", core_route_role },
                                     { NULL, NULL } };

    luaL_setfuncs(L, core, 0);
}
