/*
 * Groups, classes of conditions, protecting groups and incompatible pairs on their way from Lua
 * tables into the rule book. The tables come from the embedded module `groups`, which has checked
 * names of fields and the types of values.
 */
#include "script/host.h"

#include <stdio.h>
#include <string.h>

/* Raises the error of the book; `smarts` is the text that "smarts: ..." is about. */
static int raise_error(lua_State *L, const char *word, const char *name, const char *smarts)
{
    bs_ctx *cx = bsl_host_of(L)->cx;
    char message[BS_MESSAGE_MAX];
    const char *input = strncmp(cx->error.message, "smarts", 6) == 0 ? smarts : NULL;

    snprintf(message, sizeof message, "%s", cx->error.message);
    snprintf(cx->error.message, sizeof cx->error.message, "%s \"%.100s\": %.280s", word,
             name ? name : "", message);
    if (!input)
        cx->error.offset = -1;
    return bsl_raise(L, input, input ? strlen(input) : 0);
}

static bs_fate read_fate(const char *word)
{
    bs_fate fate = BS_SURVIVES;

    for (int i = BS_SURVIVES; word && i <= BS_ATTACKED; i++) {
        if (strcmp(word, bs_fate_word((bs_fate)i)) == 0)
            fate = (bs_fate)i;
    }
    return fate;
}

/* The list { { groups = { ... }, fate =, why = }, ... } in a field of the table at 1. */
static const bs_fate_def *read_fates(lua_State *L, int *count)
{
    bsl_host *host = bsl_host_of(L);
    bs_fate_def *fates;

    lua_getfield(L, 1, "fates");
    luaL_checktype(L, -1, LUA_TTABLE);
    *count = (int)lua_rawlen(L, -1);
    if (bs_new(host->cx, &host->results, *count + 1, &fates) != BS_OK)
        bsl_raise(L, NULL, 0);
    for (int i = 0; i < *count; i++) {
        lua_rawgeti(L, -1, i + 1);
        fates[i].groups = bsl_words_field(L, -1, "groups");
        fates[i].fate = read_fate(bsl_text_field(L, -1, "fate"));
        fates[i].why = bsl_text_field(L, -1, "why");
        lua_pop(L, 1);
    }
    lua_pop(L, 1);
    return fates;
}

/* core.group{ name=, title=, smarts=, parents=, also=, tests={ { smiles=, hits= } } } */
static int core_group(lua_State *L)
{
    bsl_host *host = bsl_host_of(L);
    bs_mark mark = bs_arena_mark(&host->results);
    bs_group_def def = { 0 };
    bs_group_test *tests;

    luaL_checktype(L, 1, LUA_TTABLE);
    bsl_check_growth(L);
    if (host->kind == BSL_LANE)
        return 0;
    def.name = bsl_text_field(L, 1, "name");
    def.title = bsl_text_field(L, 1, "title");
    def.smarts = bsl_text_field(L, 1, "smarts");
    def.source = bsl_text_field(L, 1, "source");
    def.origin = bsl_text_field(L, 1, "origin");
    def.parents = bsl_words_field(L, 1, "parents");
    def.also = bsl_words_field(L, 1, "also");
    def.pack = bsl_pack_name(host);
    lua_getfield(L, 1, "tests");
    luaL_checktype(L, -1, LUA_TTABLE);
    def.test_count = (int)lua_rawlen(L, -1);
    if (bs_new(host->cx, &host->results, def.test_count + 1, &tests) != BS_OK)
        return bsl_raise_from(L, mark, NULL, 0);
    for (int i = 0; i < def.test_count; i++) {
        lua_rawgeti(L, -1, i + 1);
        tests[i].smiles = bsl_text_field(L, -1, "smiles");
        lua_getfield(L, -1, "hits");
        tests[i].hits = (int)lua_tointeger(L, -1);
        lua_pop(L, 2);
    }
    def.tests = tests;
    if (bs_rules_add_group(host->cx, host->session->rules, &def) != BS_OK)
        return raise_error(L, "group", def.name, def.smarts);
    bs_arena_rewind(&host->results, mark);
    return 0;
}

/* core.conditions{ name=, title=, reagents=, used_for=, also=, fates={...} } */
static int core_conditions(lua_State *L)
{
    bsl_host *host = bsl_host_of(L);
    bs_mark mark = bs_arena_mark(&host->results);
    bs_conditions_def def = { 0 };

    luaL_checktype(L, 1, LUA_TTABLE);
    bsl_check_growth(L);
    if (host->kind == BSL_LANE)
        return 0;
    def.name = bsl_text_field(L, 1, "name");
    def.title = bsl_text_field(L, 1, "title");
    def.reagents = bsl_text_field(L, 1, "reagents");
    def.used_for = bsl_text_field(L, 1, "used_for");
    def.source = bsl_text_field(L, 1, "source");
    def.origin = bsl_text_field(L, 1, "origin");
    def.also = bsl_words_field(L, 1, "also");
    def.fates = read_fates(L, &def.fate_count);
    def.pack = bsl_pack_name(host);
    if (bs_rules_add_conditions(host->cx, host->session->rules, &def) != BS_OK)
        return raise_error(L, "conditions", def.name, NULL);
    bs_arena_rewind(&host->results, mark);
    return 0;
}

/* core.verdict{ conditions={...}, fates={...} } */
static int core_verdict(lua_State *L)
{
    bsl_host *host = bsl_host_of(L);
    bs_mark mark = bs_arena_mark(&host->results);
    bs_words classes;
    const bs_fate_def *fates;
    int count;

    luaL_checktype(L, 1, LUA_TTABLE);
    bsl_check_growth(L);
    if (host->kind == BSL_LANE)
        return 0;
    classes = bsl_words_field(L, 1, "conditions");
    fates = read_fates(L, &count);
    for (int i = 0; i < classes.count; i++) {
        if (bs_rules_add_fate(host->cx, host->session->rules, classes.items[i], &fates[0]) != BS_OK)
            return raise_error(L, "verdict on", fates[0].groups.items[0], NULL);
    }
    bs_arena_rewind(&host->results, mark);
    return 0;
}

/* core.protecting{ name=, title=, group=, like=, example=, guards=, ..., fates={...} } */
static int core_protecting(lua_State *L)
{
    bsl_host *host = bsl_host_of(L);
    bs_mark mark = bs_arena_mark(&host->results);
    bs_protecting_def def = { 0 };

    luaL_checktype(L, 1, LUA_TTABLE);
    bsl_check_growth(L);
    if (host->kind == BSL_LANE)
        return 0;
    def.name = bsl_text_field(L, 1, "name");
    def.title = bsl_text_field(L, 1, "title");
    def.group = bsl_text_field(L, 1, "group");
    def.like = bsl_text_field(L, 1, "like");
    def.example = bsl_text_field(L, 1, "example");
    def.install_reagents = bsl_text_field(L, 1, "install_reagents");
    def.removal_reagents = bsl_text_field(L, 1, "removal_reagents");
    def.remarks = bsl_text_field(L, 1, "remarks");
    def.source = bsl_text_field(L, 1, "source");
    def.origin = bsl_text_field(L, 1, "origin");
    def.guards = bsl_words_field(L, 1, "guards");
    def.installed_by = bsl_words_field(L, 1, "installed_by");
    def.removed_by = bsl_words_field(L, 1, "removed_by");
    def.fates = read_fates(L, &def.fate_count);
    def.pack = bsl_pack_name(host);
    if (bs_rules_add_protecting(host->cx, host->session->rules, &def) != BS_OK)
        return raise_error(L, "protecting", def.name, NULL);
    bs_arena_rewind(&host->results, mark);
    return 0;
}

/* core.incompatible{ name=, one={...}, other={...}, conditions={...}, fate=, why= } */
static int core_incompatible(lua_State *L)
{
    bsl_host *host = bsl_host_of(L);
    bs_mark mark = bs_arena_mark(&host->results);
    bs_incompatible_def def = { 0 };

    luaL_checktype(L, 1, LUA_TTABLE);
    bsl_check_growth(L);
    if (host->kind == BSL_LANE)
        return 0;
    def.name = bsl_text_field(L, 1, "name");
    def.one = bsl_words_field(L, 1, "one");
    def.other = bsl_words_field(L, 1, "other");
    def.conditions = bsl_words_field(L, 1, "conditions");
    def.fate = read_fate(bsl_text_field(L, 1, "fate"));
    def.why = bsl_text_field(L, 1, "why");
    def.source = bsl_text_field(L, 1, "source");
    def.origin = bsl_text_field(L, 1, "origin");
    def.pack = bsl_pack_name(host);
    if (bs_rules_add_incompatible(host->cx, host->session->rules, &def) != BS_OK)
        return raise_error(L, "incompatible", def.name, NULL);
    bs_arena_rewind(&host->results, mark);
    return 0;
}

static void set_text(lua_State *L, const char *field, const char *text)
{
    if (!text)
        return;
    lua_pushstring(L, text);
    lua_setfield(L, -2, field);
}

static void set_words(lua_State *L, const char *field, const bs_words *words)
{
    bsl_push_words(L, words->items, words->count);
    lua_setfield(L, -2, field);
}

/* table = core.nth_group(index), 0-based, or nil */
static int core_nth_group(lua_State *L)
{
    const bs_rules *rules = bsl_host_of(L)->session->rules;
    lua_Integer index = luaL_checkinteger(L, 1);
    const bs_group_def *def;

    if (index < 0 || index >= bs_rules_group_count(rules))
        return 0;
    def = bs_rules_group(rules, (int)index);
    lua_createtable(L, 0, 8);
    set_text(L, "name", def->name);
    set_text(L, "title", def->title);
    set_text(L, "smarts", def->smarts);
    set_text(L, "pack", def->pack);
    set_text(L, "origin", def->origin);
    set_words(L, "parents", &def->parents);
    set_words(L, "also", &def->also);
    lua_createtable(L, def->test_count, 0);
    for (int i = 0; i < def->test_count; i++) {
        lua_createtable(L, 0, 2);
        set_text(L, "smiles", def->tests[i].smiles);
        lua_pushinteger(L, def->tests[i].hits);
        lua_setfield(L, -2, "hits");
        lua_rawseti(L, -2, i + 1);
    }
    lua_setfield(L, -2, "tests");
    return 1;
}

/* table = core.nth_conditions(index), 0-based, or nil */
static int core_nth_conditions(lua_State *L)
{
    const bs_rules *rules = bsl_host_of(L)->session->rules;
    lua_Integer index = luaL_checkinteger(L, 1);
    const bs_conditions_def *def;

    if (index < 0 || index >= bs_rules_conditions_count(rules))
        return 0;
    def = bs_rules_conditions(rules, (int)index);
    lua_createtable(L, 0, 8);
    set_text(L, "name", def->name);
    set_text(L, "title", def->title);
    set_text(L, "reagents", def->reagents);
    set_text(L, "used_for", def->used_for);
    set_text(L, "source", def->source);
    set_text(L, "pack", def->pack);
    set_text(L, "origin", def->origin);
    return 1;
}

/* yes = core.names_group(word), core.names_conditions(word) */
static int core_names_group(lua_State *L)
{
    lua_pushboolean(L, bs_rules_find_group(bsl_host_of(L)->session->rules,
                                           luaL_checkstring(L, 1)) >= 0);
    return 1;
}

static int core_names_conditions(lua_State *L)
{
    lua_pushboolean(L, bs_rules_find_conditions(bsl_host_of(L)->session->rules,
                                                luaL_checkstring(L, 1)) >= 0);
    return 1;
}

void bsl_open_group(lua_State *L)
{
    static const luaL_Reg functions[] = {
        { "group", core_group },
        { "conditions", core_conditions },
        { "verdict", core_verdict },
        { "protecting", core_protecting },
        { "incompatible", core_incompatible },
        { "nth_group", core_nth_group },
        { "nth_conditions", core_nth_conditions },
        { "names_group", core_names_group },
        { "names_conditions", core_names_conditions },
        { NULL, NULL },
    };

    luaL_setfuncs(L, functions, 0);
}
