/* The constraints of a plan, from the plain lists of the embedded module `constraint`. */
#include "script/host.h"

/* Room for `count` elements in the results arena. */
static void *take(lua_State *L, size_t count, size_t size)
{
    bsl_host *host = bsl_host_of(L);
    void *room;

    if (bs_new_array(host->cx, &host->results, count + 1, size, &room) != BS_OK)
        bsl_raise(L, NULL, 0);
    return room;
}

/* Pushes the list of a field of the table at the top, or nil; gives its length. */
static int push_list(lua_State *L, const char *field)
{
    return lua_getfield(L, -1, field) == LUA_TTABLE ? (int)lua_rawlen(L, -1) : 0;
}

static const bs_step_test *read_tests(lua_State *L, const char *field, int *count)
{
    bs_step_test *tests;

    *count = push_list(L, field);
    tests = take(L, (size_t)*count, sizeof *tests);
    for (int i = 0; i < *count; i++) {
        lua_rawgeti(L, -1, i + 1);
        lua_getfield(L, -1, "word");
        lua_getfield(L, -2, "transform");
        lua_getfield(L, -3, "molecule");
        lua_getfield(L, -4, "pattern");
        lua_getfield(L, -5, "most");
        tests[i].word = lua_tostring(L, -5);
        tests[i].transform = lua_tostring(L, -4);
        tests[i].mol = bsl_testmol(L, -3);
        tests[i].pattern = lua_isnil(L, -2) ? NULL : bsl_topattern(L, lua_absindex(L, -2));
        tests[i].most = (int)lua_tointeger(L, -1);
        lua_pop(L, 6);
    }
    lua_pop(L, 1);
    return tests;
}

static const bs_mol *const *read_mols(lua_State *L, const char *field, int *count)
{
    const bs_mol **mols;

    *count = push_list(L, field);
    mols = take(L, (size_t)*count, sizeof *mols);
    for (int i = 0; i < *count; i++) {
        lua_rawgeti(L, -1, i + 1);
        mols[i] = bsl_checkmol(L, -1);
        lua_pop(L, 1);
    }
    lua_pop(L, 1);
    return mols;
}

static const bs_pattern *const *read_patterns(lua_State *L, const char *field, int *count)
{
    const bs_pattern **patterns;

    *count = push_list(L, field);
    patterns = take(L, (size_t)*count, sizeof *patterns);
    for (int i = 0; i < *count; i++) {
        lua_rawgeti(L, -1, i + 1);
        patterns[i] = bsl_topattern(L, lua_absindex(L, -1));
        lua_pop(L, 1);
    }
    lua_pop(L, 1);
    return patterns;
}

static const bs_target_bond *read_bonds(lua_State *L, const char *field, int *count)
{
    bs_target_bond *bonds;

    *count = push_list(L, field);
    bonds = take(L, (size_t)*count, sizeof *bonds);
    for (int i = 0; i < *count; i++) {
        lua_rawgeti(L, -1, i + 1);
        lua_rawgeti(L, -1, 1);
        lua_rawgeti(L, -2, 2);
        bonds[i].a = (int)lua_tointeger(L, -2) - 1;
        bonds[i].b = (int)lua_tointeger(L, -1) - 1;
        lua_pop(L, 3);
    }
    lua_pop(L, 1);
    return bonds;
}

static bool read_flag(lua_State *L, const char *field)
{
    bool flag = lua_getfield(L, -1, field) == LUA_TBOOLEAN && lua_toboolean(L, -1);

    lua_pop(L, 1);
    return flag;
}

const bs_constraints *bsl_read_constraints(lua_State *L, int i)
{
    bs_constraints *c = NULL;

    luaL_checkstack(L, 12, "constraints");
    if (lua_getfield(L, i, "constraints") == LUA_TTABLE) {
        c = take(L, 1, sizeof *c);
        c->avoid = read_tests(L, "avoid", &c->avoid_count);
        c->use = read_tests(L, "use", &c->use_count);
        c->at_most = read_tests(L, "at_most", &c->at_most_count);
        c->start = read_mols(L, "start_from", &c->start_count);
        c->not_bought = read_mols(L, "not_bought", &c->not_bought_count);
        c->intact = read_patterns(L, "intact", &c->intact_count);
        c->keep = read_bonds(L, "keep", &c->keep_count);
        c->cut = read_bonds(L, "cut", &c->cut_count);
        c->first = read_bonds(L, "first", &c->first_count);
        c->has_protections = lua_getfield(L, -1, "protections") == LUA_TNUMBER;
        c->protections = (int)lua_tointeger(L, -1);
        lua_pop(L, 1);
        c->unprotect = read_flag(L, "unprotect");
        c->convergent = read_flag(L, "convergent");
    }
    lua_pop(L, 1);
    return c;
}
