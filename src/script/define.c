/*
 * Definitions: synthons and transforms on their way from Lua tables into the rule book. The
 * tables come from the embedded module `pack`, which has checked names of fields and the types
 * of values, so what is wrong here is wrong chemically. A lane reads packs only for their
 * functions: there, nothing is added to the book.
 */
#include "script/host.h"

#include <stdio.h>
#include <string.h>

const char *bsl_keep(lua_State *L, const char *text, size_t length)
{
    bs_session *session = bsl_host_of(L)->session;
    char *copy;

    if (bs_copy_text(&session->cx, &session->home, text, length, &copy) != BS_OK)
        bsl_raise(L, NULL, 0);
    return copy;
}

const char *bsl_text_field(lua_State *L, int i, const char *field)
{
    const char *text = NULL;

    lua_getfield(L, i, field);
    if (lua_type(L, -1) == LUA_TSTRING)
        text = lua_tostring(L, -1);
    lua_pop(L, 1);
    return text;
}

static double number_field(lua_State *L, int i, const char *field)
{
    double value;

    lua_getfield(L, i, field);
    value = lua_tonumber(L, -1);
    lua_pop(L, 1);
    return value;
}

bs_words bsl_words_field(lua_State *L, int i, const char *field)
{
    bsl_host *host = bsl_host_of(L);
    bs_words words = {NULL, 0};
    const char **items;

    if (lua_getfield(L, i, field) == LUA_TTABLE) {
        words.count = (int)lua_rawlen(L, -1);
        if (bs_new(host->cx, &host->results, words.count + 1, &items) != BS_OK)
            bsl_raise(L, NULL, 0);
        for (int k = 0; k < words.count; k++) {
            lua_rawgeti(L, -1, k + 1);
            items[k] = lua_tostring(L, -1);
            lua_pop(L, 1);
        }
        words.items = items;
    }
    lua_pop(L, 1);
    return words;
}

/* The two numbers in a field of the table at `i`. */
static void pair_field(lua_State *L, int i, const char *field, double pair[2])
{
    pair[0] = pair[1] = 0;
    if (lua_getfield(L, i, field) == LUA_TTABLE) {
        for (int k = 0; k < 2; k++) {
            lua_rawgeti(L, -1, k + 1);
            pair[k] = lua_tonumber(L, -1);
            lua_pop(L, 1);
        }
    }
    lua_pop(L, 1);
}

/* The field { map, "synthon" } of the table at `i`. */
static void end_field(lua_State *L, int i, const char *field, int *map, const char **name)
{
    if (lua_getfield(L, i, field) == LUA_TTABLE) {
        lua_rawgeti(L, -1, 1);
        *map = (int)lua_tointeger(L, -1);
        lua_rawgeti(L, -2, 2);
        *name = lua_tostring(L, -1);
        lua_pop(L, 2);
    }
    lua_pop(L, 1);
}

int bsl_keep_hook(lua_State *L, int i)
{
    bsl_host *host = bsl_host_of(L);
    int number;

    i = lua_absindex(L, i);
    if (host->hook_next > 0xFFFF)
        return luaL_error(L, "more than 65536 functions in a pack");
    number = host->pack << 16 | host->hook_next++;
    if (host->kind != BSL_LANE)
        host->session->pack_list[host->pack].hooked = true;
    lua_getfield(L, LUA_REGISTRYINDEX, "backsaw.hooks");
    lua_pushvalue(L, i);
    lua_rawseti(L, -2, number);
    lua_pop(L, 1);
    return number;
}

bool bsl_has_own_hooks(const bs_session *session)
{
    return session->pack_list[0].hooked;
}

static int hook_field(lua_State *L, int i, const char *field)
{
    int number = -1;

    if (lua_getfield(L, i, field) == LUA_TFUNCTION)
        number = bsl_keep_hook(L, -1);
    lua_pop(L, 1);
    return number;
}

const char *bsl_pack_name(const bsl_host *host)
{
    return host->pack > 0 ? host->session->pack_list[host->pack].name : NULL;
}

/* Raises the error of the book, in whose message the name of the field tells which text is meant.
 */
static int raise_definition(lua_State *L, const char *name, const char *target, const char *from)
{
    bs_ctx *cx = bsl_host_of(L)->cx;
    char message[BS_MESSAGE_MAX];
    const char *input = NULL;

    snprintf(message, sizeof message, "%s", cx->error.message);
    if (strncmp(message, "target", 6) == 0)
        input = target;
    else if (strncmp(message, "from", 4) == 0)
        input = from;
    snprintf(cx->error.message, sizeof cx->error.message, "%.100s: %.280s", name, message);
    return bsl_raise(L, input, input ? strlen(input) : 0);
}

static void read_equivalents(lua_State *L, int i, bs_equivalent_def *items, int count)
{
    for (int k = 0; k < count; k++) {
        lua_rawgeti(L, i, k + 1);
        items[k].attach = bsl_text_field(L, -1, "attach");
        items[k].rewrite = bsl_text_field(L, -1, "rewrite");
        items[k].name = bsl_text_field(L, -1, "name");
        items[k].equivalents = number_field(L, -1, "equivalents");
        lua_getfield(L, -1, "ionic");
        items[k].ionic = lua_toboolean(L, -1);
        lua_pop(L, 2);
    }
}

/*
 * Adds a synthon. What the user's own code has defined, it may define anew, as one does at a
 * prompt; what packs have defined stands.
 */
static bs_status add_synthon(lua_State *L, const bs_synthon_def *def)
{
    bsl_host *host = bsl_host_of(L);
    bs_rules *rules = host->session->rules;
    bool own;
    bs_status st;

    if (host->kind != BSL_MAIN)
        return bs_rules_add_synthon(host->cx, rules, def);
    lua_getfield(L, LUA_REGISTRYINDEX, "backsaw.own_synthons");
    own = lua_getfield(L, -1, def->name) != LUA_TNIL;
    lua_pop(L, 1);
    if (own)
        bs_rules_retire_synthon(rules, def->name, true);
    st = bs_rules_add_synthon(host->cx, rules, def);
    if (st == BS_OK) {
        lua_pushboolean(L, 1);
        lua_setfield(L, -2, def->name);
    } else if (own) {
        bs_rules_retire_synthon(rules, def->name, false);
    }
    lua_pop(L, 1);
    return st;
}

/* The same for a transform. */
static bs_status add_transform(bsl_host *host, const bs_transform_def *def, int *index)
{
    bs_rules *rules = host->session->rules;
    int old = host->kind == BSL_MAIN ? bs_rules_find(rules, def->name) : -1;
    bs_status st;

    if (old >= 0 && bs_rules_transform(rules, old)->pack)
        old = -1;
    if (old >= 0)
        bs_rules_retire_transform(rules, old, true);
    st = bs_rules_add_transform(host->cx, rules, def, index);
    if (old >= 0 && st != BS_OK)
        bs_rules_retire_transform(rules, old, false);
    return st;
}

/* core.synthon{ name=, kind=, origin=, equivalents={ { attach=, rewrite=, name=, ionic= } } } */
static int core_synthon(lua_State *L)
{
    bsl_host *host = bsl_host_of(L);
    bs_mark mark = bs_arena_mark(&host->results);
    bs_synthon_def def = {0};
    bs_equivalent_def *items;
    const char *kind;

    luaL_checktype(L, 1, LUA_TTABLE);
    if (host->kind == BSL_LANE)
        return 0;
    bsl_check_growth(L);
    def.name = bsl_text_field(L, 1, "name");
    def.origin = bsl_text_field(L, 1, "origin");
    kind = bsl_text_field(L, 1, "kind");
    def.kind = kind && strcmp(kind, "donor") == 0 ? BS_DONOR : BS_ACCEPTOR;
    lua_getfield(L, 1, "equivalents");
    luaL_checktype(L, -1, LUA_TTABLE);
    def.equivalent_count = (int)lua_rawlen(L, -1);
    if (bs_new(host->cx, &host->results, def.equivalent_count + 1, &items) != BS_OK)
        return bsl_raise(L, NULL, 0);
    read_equivalents(L, lua_gettop(L), items, def.equivalent_count);
    def.equivalents = items;
    if (add_synthon(L, &def) != BS_OK)
        return raise_definition(L, def.name, NULL, NULL);
    bs_arena_rewind(&host->results, mark);
    return 0;
}

/* Keeps the list of self-tests at the top of the stack for transform `index`. */
static void keep_examples(lua_State *L, int index, const char *origin)
{
    bs_session *session = bsl_host_of(L)->session;
    int count = (int)lua_rawlen(L, -1);

    for (int k = 0; k < count; k++) {
        bsl_example *example;
        bs_words from;

        lua_rawgeti(L, -1, k + 1);
        if (bs_new(&session->cx, &session->home, 1, &example) != BS_OK)
            bsl_raise(L, NULL, 0);
        example->transform = index;
        example->origin = origin;
        example->product = bsl_text_field(L, -1, "product");
        example->product = bsl_keep(L, example->product, strlen(example->product));
        lua_getfield(L, -1, "refuse");
        example->refuse = lua_toboolean(L, -1);
        lua_pop(L, 1);
        from = bsl_words_field(L, -1, "from");
        if (bs_new(&session->cx, &session->home, from.count + 1, &example->from) != BS_OK)
            bsl_raise(L, NULL, 0);
        for (int n = 0; n < from.count; n++)
            example->from[example->from_count++] =
                bsl_keep(L, from.items[n], strlen(from.items[n]));
        *session->examples_end = example;
        session->examples_end = &example->next;
        lua_pop(L, 1);
    }
}

/* The field prefer = { preference, roles = { ... }, maps = { ... } } that names a shared one. */
static void read_prefer(lua_State *L, bs_transform_def *def)
{
    bsl_host *host = bsl_host_of(L);
    int *maps;

    if (lua_getfield(L, 1, "prefer") == LUA_TTABLE) {
        def->prefer = bsl_text_field(L, -1, "name");
        def->prefer_roles = bsl_words_field(L, lua_gettop(L), "roles");
        if (bs_new(host->cx, &host->results, def->prefer_roles.count + 1, &maps) != BS_OK)
            bsl_raise(L, NULL, 0);
        lua_getfield(L, -1, "maps");
        for (int i = 0; i < def->prefer_roles.count; i++) {
            lua_rawgeti(L, -1, i + 1);
            maps[i] = (int)lua_tointeger(L, -1);
            lua_pop(L, 1);
        }
        lua_pop(L, 1);
        def->prefer_maps = maps;
    }
    lua_pop(L, 1);
}

static void read_transform(lua_State *L, bs_transform_def *def)
{
    const char *kind = bsl_text_field(L, 1, "kind");
    double pair[2];

    def->kind = kind && strcmp(kind, "interconversion") == 0 ? BS_INTERCONVERSION
                                                             : BS_DISCONNECTION;
    def->name = bsl_text_field(L, 1, "name");
    def->also = bsl_words_field(L, 1, "also");
    def->target = bsl_text_field(L, 1, "target");
    def->from = bsl_text_field(L, 1, "from");
    pair_field(L, 1, "cut", pair);
    def->cut[0] = (int)pair[0];
    def->cut[1] = (int)pair[1];
    end_field(L, 1, "acceptor", &def->acceptor_map, &def->acceptor);
    end_field(L, 1, "donor", &def->donor_map, &def->donor);
    def->conditions = bsl_text_field(L, 1, "conditions");
    def->recipe = bsl_text_field(L, 1, "recipe");
    pair_field(L, 1, "yield", pair);
    def->yield_low = pair[0];
    def->yield_high = pair[1];
    def->step_cost = number_field(L, 1, "step_cost");
    def->spares = bsl_words_field(L, 1, "spares");
    def->also_attacks = bsl_words_field(L, 1, "also_attacks");
    def->cautions = bsl_words_field(L, 1, "cautions");
    def->reagents = bsl_words_field(L, 1, "reagents");
    def->source = bsl_text_field(L, 1, "source");
    def->rxno = bsl_text_field(L, 1, "rxno");
    def->origin = bsl_text_field(L, 1, "origin");
    read_prefer(L, def);
    if (lua_getfield(L, 1, "addition") == LUA_TTABLE) {
        const char *way = bsl_text_field(L, -1, "way");

        def->addition = way && strcmp(way, "syn") == 0 ? BS_ADDITION_SYN : BS_ADDITION_ANTI;
        pair_field(L, lua_gettop(L), "maps", pair);
        def->addition_maps[0] = (int)pair[0];
        def->addition_maps[1] = (int)pair[1];
    }
    lua_pop(L, 1);
}

/* core.preference{ name=, roles={...}, score=function, origin= } */
static int core_preference(lua_State *L)
{
    bsl_host *host = bsl_host_of(L);
    bs_mark mark = bs_arena_mark(&host->results);
    bs_preference_def def = {0};

    luaL_checktype(L, 1, LUA_TTABLE);
    def.hook = hook_field(L, 1, "score");
    if (host->kind == BSL_LANE)
        return 0;
    def.name = bsl_text_field(L, 1, "name");
    def.origin = bsl_text_field(L, 1, "origin");
    def.roles = bsl_words_field(L, 1, "roles");
    if (bs_rules_add_preference(host->cx, host->session->rules, &def) != BS_OK)
        return raise_definition(L, def.name, NULL, NULL);
    bs_arena_rewind(&host->results, mark);
    return 0;
}

/* index = core.transform{...}: the fields of a transform; 0-based, nil in a lane */
static int core_transform(lua_State *L)
{
    bsl_host *host = bsl_host_of(L);
    bs_mark mark = bs_arena_mark(&host->results);
    bs_transform_def def = {0};
    int index;

    luaL_checktype(L, 1, LUA_TTABLE);
    def.hook_when = hook_field(L, 1, "when");
    def.hook_prefer = hook_field(L, 1, "prefer");
    if (host->kind == BSL_LANE)
        return 0;
    bsl_check_growth(L);
    read_transform(L, &def);
    def.pack = bsl_pack_name(host);
    if (add_transform(host, &def, &index) != BS_OK) {
        bs_arena_rewind(&host->results, mark);
        return raise_definition(L, def.name, def.target, def.from);
    }
    lua_getfield(L, 1, "examples");
    keep_examples(L, index, bs_rules_transform(host->session->rules, index)->origin);
    bs_arena_rewind(&host->results, mark);
    lua_pushinteger(L, index);
    return 1;
}

/* list = core.examples(index): { { product=, from={...}, refuse=, origin= }, ... } */
static int core_examples(lua_State *L)
{
    lua_Integer index = luaL_checkinteger(L, 1);
    int n = 0;

    lua_newtable(L);
    for (const bsl_example *e = bsl_host_of(L)->session->examples; e; e = e->next) {
        if (e->transform != index)
            continue;
        lua_createtable(L, 0, 4);
        lua_pushstring(L, e->product);
        lua_setfield(L, -2, "product");
        lua_createtable(L, e->from_count, 0);
        for (int k = 0; k < e->from_count; k++) {
            lua_pushstring(L, e->from[k]);
            lua_rawseti(L, -2, k + 1);
        }
        lua_setfield(L, -2, "from");
        lua_pushboolean(L, e->refuse);
        lua_setfield(L, -2, "refuse");
        lua_pushstring(L, e->origin);
        lua_setfield(L, -2, "origin");
        lua_rawseti(L, -2, ++n);
    }
    return 1;
}

void bsl_open_define(lua_State *L)
{
    static const luaL_Reg functions[] = {{"synthon", core_synthon},
                                         {"transform", core_transform},
                                         {"preference", core_preference},
                                         {"examples", core_examples},
                                         {NULL, NULL}};

    luaL_setfuncs(L, functions, 0);
    lua_newtable(L);
    lua_setfield(L, LUA_REGISTRYINDEX, "backsaw.own_synthons");
}
