/*
 * Catalogues in Lua. The box is made empty and owns the open file; its finaliser may run twice.
 */
#include "script/host.h"


#define CATALOGUE_TYPE "backsaw.catalogue"

typedef struct catalogue_box {
    bs_catalogue *catalogue; /* NULL once closed */
    int lent;                /* to searches that are running */
} catalogue_box;

bs_catalogue *bsl_testcatalogue(lua_State *L, int i)
{
    catalogue_box *box = luaL_testudata(L, i, CATALOGUE_TYPE);

    if (box && !box->catalogue)
        bsl_error(L, BS_EVALUE, "the catalogue is closed");
    return box ? box->catalogue : NULL;
}

void bsl_lend_catalogue(lua_State *L, int i, int change)
{
    catalogue_box *box = luaL_testudata(L, i, CATALOGUE_TYPE);

    if (box)
        box->lent += change;
}

static bs_catalogue *check_catalogue(lua_State *L, int i)
{
    bs_catalogue *catalogue = bsl_testcatalogue(L, i);

    if (!catalogue)
        bsl_type_error(L, i, "catalogue");
    return catalogue;
}


/* c = core.open_catalogue(path) */
static int core_open_catalogue(lua_State *L)
{
    const char *path = luaL_checkstring(L, 1);
    catalogue_box *box = lua_newuserdatauv(L, sizeof *box, 1);

    box->catalogue = NULL;
    box->lent = 0;
    luaL_setmetatable(L, CATALOGUE_TYPE);
    lua_pushvalue(L, 1);
    lua_setiuservalue(L, -2, 1);
    if (bs_catalogue_open(bsl_host_of(L)->cx, path, &box->catalogue) != BS_OK) {
        box->catalogue = NULL;
        return bsl_raise(L, NULL, 0);
    }
    return 1;
}

/* report = core.build_catalogue(inputs, output): a table with lines, offers, refused, ... */
static int core_build_catalogue(lua_State *L)
{
    bsl_host *host = bsl_host_of(L);
    bs_mark mark = bs_arena_mark(&host->results);
    const char *output = luaL_checkstring(L, 2);
    bs_import_report report = { 0 };
    const char **inputs;
    int count;

    luaL_checktype(L, 1, LUA_TTABLE);
    count = (int)lua_rawlen(L, 1);
    if (bs_new(host->cx, &host->results, count + 1, &inputs) != BS_OK)
        return bsl_raise_from(L, mark, NULL, 0);
    for (int i = 0; i < count; i++) {
        lua_rawgeti(L, 1, i + 1);
        inputs[i] = lua_tostring(L, -1);
        luaL_argcheck(L, inputs[i], 1, "a list of file names is expected");
        lua_pop(L, 1);
    }
    if (bs_catalogue_build(host->cx, inputs, count, output, &report) != BS_OK) {
        bs_arena_rewind(&host->results, mark);
        return bsl_raise(L, NULL, 0);
    }
    bs_arena_rewind(&host->results, mark);
    lua_createtable(L, 0, 5);
    lua_pushinteger(L, report.lines);
    lua_setfield(L, -2, "lines");
    lua_pushinteger(L, report.offers);
    lua_setfield(L, -2, "offers");
    lua_pushinteger(L, report.refused);
    lua_setfield(L, -2, "refused");
    lua_pushinteger(L, report.first_refused_line);
    lua_setfield(L, -2, "first_refused_line");
    lua_pushstring(L, report.first_refused);
    lua_setfield(L, -2, "first_refused");
    return 1;
}

static void set_number(lua_State *L, const char *field, double value)
{
    if (!(value >= 0))
        return;
    bsl_push_number(L, value);
    lua_setfield(L, -2, field);
}

static void set_text(lua_State *L, const char *field, const char *text)
{
    if (!text)
        return;
    lua_pushstring(L, text);
    lua_setfield(L, -2, field);
}

void bsl_push_offer(lua_State *L, const bs_offer *offer)
{
    lua_createtable(L, 0, 8);
    set_text(L, "code", offer->code);
    set_text(L, "name", offer->name);
    set_number(L, "price_per_gram", offer->price_per_gram);
    set_number(L, "container_g", offer->container_g);
    set_number(L, "lead_days", offer->lead_days);
    set_text(L, "ground", offer->ground);
    if (offer->smiles) {
        lua_pushstring(L, offer->smiles);
        bsl_tomol(L, -1);
        lua_setfield(L, -2, "molecule");
    }
    lua_getfield(L, LUA_REGISTRYINDEX, "backsaw.core");
    lua_getfield(L, -1, "offer_type");
    lua_remove(L, -2);
    if (lua_istable(L, -1))
        lua_setmetatable(L, -2);
    else
        lua_pop(L, 1);
}

/* offers = c:find(m): the cheapest per gram first */
static int catalogue_find(lua_State *L)
{
    bsl_host *host = bsl_host_of(L);
    bs_catalogue *catalogue = check_catalogue(L, 1);
    const bs_mol *mol = bsl_tomol(L, 2);
    bs_mark mark = bs_arena_mark(&host->results);
    bs_offers offers;

    if (bs_catalogue_find(host->cx, &host->results, catalogue, mol, &offers) != BS_OK)
        return bsl_raise_from(L, mark, NULL, 0);
    lua_createtable(L, offers.count, 0);
    for (int i = 0; i < offers.count; i++) {
        bsl_push_offer(L, &offers.items[i]);
        lua_rawseti(L, -2, i + 1);
    }
    bs_arena_rewind(&host->results, mark);
    return 1;
}

/* found = c:has(m) */
static int catalogue_has(lua_State *L)
{
    bsl_host *host = bsl_host_of(L);
    bs_catalogue *catalogue = check_catalogue(L, 1);
    const bs_mol *mol = bsl_tomol(L, 2);
    bs_mark mark = bs_arena_mark(&host->results);
    bs_offers offers;

    if (bs_catalogue_find(host->cx, &host->results, catalogue, mol, &offers) != BS_OK)
        return bsl_raise_from(L, mark, NULL, 0);
    bs_arena_rewind(&host->results, mark);
    lua_pushboolean(L, offers.count > 0);
    return 1;
}

/* n = #c */
static int catalogue_len(lua_State *L)
{
    lua_pushinteger(L, bs_catalogue_count(check_catalogue(L, 1)));
    return 1;
}

/* c:close() */
static int catalogue_close(lua_State *L)
{
    catalogue_box *box = luaL_checkudata(L, 1, CATALOGUE_TYPE);

    if (box->lent > 0)
        return bsl_error(L, BS_EVALUE, "the catalogue is in use by a plan");
    bs_catalogue_close(box->catalogue);
    box->catalogue = NULL;
    return 0;
}

/* text = tostring(c) */
static int catalogue_tostring(lua_State *L)
{
    catalogue_box *box = luaL_checkudata(L, 1, CATALOGUE_TYPE);

    lua_getiuservalue(L, 1, 1);
    if (box->catalogue)
        lua_pushfstring(L, "catalogue %s, %I offers", lua_tostring(L, -1),
                        (LUAI_UACINT)bs_catalogue_count(box->catalogue));
    else
        lua_pushfstring(L, "catalogue %s, closed", lua_tostring(L, -1));
    return 1;
}

void bsl_open_catalogue(lua_State *L)
{
    static const luaL_Reg methods[] = {
        { "find", catalogue_find },
        { "has", catalogue_has },
        { "close", catalogue_close },
        { NULL, NULL },
    };
    static const luaL_Reg meta[] = {
        { "__len", catalogue_len },
        { "__tostring", catalogue_tostring },
        { "__gc", catalogue_close },
        { "__close", catalogue_close },
        { NULL, NULL },
    };
    static const luaL_Reg functions[] = {
        { "open_catalogue", core_open_catalogue },
        { "build_catalogue", core_build_catalogue },
        { NULL, NULL },
    };

    bsl_new_type(L, CATALOGUE_TYPE, methods, meta);
    luaL_setfuncs(L, functions, 0);
}
