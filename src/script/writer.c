/*
 * Writing files of molecules from Lua: w:write(m [, { name = ..., fields = ... }]), w:close(). A
 * writer that goes out of use without being closed leaves no file.
 */
#include "script/host.h"

#include <stdlib.h>
#include <string.h>

#define WRITER_TYPE "backsaw.writer"

/* Lua's registry of one record: its texts stay on the stack while it is written. */
typedef struct writer_box {
    bs_ctx cx;
    bs_file_writer *writer; /* NULL once closed */
} writer_box;

static void drop(writer_box *box)
{
    bs_file_abandon(box->writer);
    box->writer = NULL;
    bs_arena_free(&box->cx.scratch);
}

static int raise_own(lua_State *L, const writer_box *box)
{
    bsl_fault fault = {.code = box->cx.error.code};

    bsl_where(L, fault.where, sizeof fault.where);
    snprintf(fault.message, sizeof fault.message, "%s", box->cx.error.message);
    return bsl_raise_fault(L, &fault);
}

/* w = core.create_molecules(path) */
static int core_create_molecules(lua_State *L)
{
    const bs_session *session = bsl_host_of(L)->session;
    const char *path = luaL_checkstring(L, 1);
    writer_box *box = lua_newuserdatauv(L, sizeof *box, 0);

    bs_ctx_init(&box->cx, session->cx.gate);
    box->cx.stop = session->cx.stop;
    box->writer = NULL;
    luaL_setmetatable(L, WRITER_TYPE);
    if (bs_file_create(&box->cx, path, &box->writer) != BS_OK) {
        box->writer = NULL;
        return raise_own(L, box);
    }
    return 1;
}

/* ---- One record -------------------------------------------------------------------------------
 */

/* A field of the table at `at`, or nil if there is no table. */
static int push_part(lua_State *L, int at, const char *key)
{
    if (!lua_istable(L, at)) {
        lua_pushnil(L);
        return LUA_TNIL;
    }
    lua_pushstring(L, key);
    return lua_rawget(L, at);
}

static int compare_names(const void *a, const void *b)
{
    const bs_field *x = a;
    const bs_field *y = b;

    return strcmp(x->name, y->name);
}

/* Adds the field whose name and value are on top; the value stays in the table meanwhile. */
static void add_field(lua_State *L, bs_field *field)
{
    luaL_argcheck(L, lua_type(L, -1) == LUA_TSTRING || lua_type(L, -1) == LUA_TNUMBER, 2,
                  "the fields of a record are texts or numbers");
    field->name = lua_tolstring(L, -2, &field->name_length);
    lua_pushvalue(L, -1);
    field->value = lua_tolstring(L, -1, &field->value_length);
    /* A number becomes a text of its own, which has to live on. */
    lua_rawseti(L, 3, (lua_Integer)lua_rawlen(L, 3) + 1);
}

/*
 * The fields of the table on top: those that its list names in that order, then the others by name.
 * Slot 3 holds a table that keeps texts.
 */
static int take_fields(lua_State *L, bs_field **out)
{
    int fields = lua_gettop(L), count = 0, room = 0, listed;
    bs_field *items;

    *out = NULL;
    if (lua_isnil(L, fields))
        return 0;
    luaL_argcheck(L, lua_istable(L, fields), 2, "the fields of a record are a table");
    for (lua_pushnil(L); lua_next(L, fields); lua_pop(L, 1))
        room++;
    items = lua_newuserdatauv(L, (size_t)(room + 1) * sizeof *items, 0);
    lua_newtable(L); /* names that were met */
    for (int i = 1; lua_rawgeti(L, fields, i) == LUA_TSTRING && count < room; i++) {
        lua_pushvalue(L, -1);
        if (lua_rawget(L, fields) != LUA_TNIL)
            add_field(L, &items[count++]);
        lua_pop(L, 1);
        lua_pushboolean(L, 1);
        lua_rawset(L, fields + 2);
    }
    lua_pop(L, 1);
    listed = count;
    for (lua_pushnil(L); lua_next(L, fields); lua_pop(L, 1)) {
        if (lua_type(L, -2) != LUA_TSTRING)
            continue;
        lua_pushvalue(L, -2);
        if (lua_rawget(L, fields + 2) == LUA_TNIL) {
            lua_pop(L, 1);
            add_field(L, &items[count++]);
            continue;
        }
        lua_pop(L, 1);
    }
    qsort(items + listed, (size_t)(count - listed), sizeof *items, compare_names);
    *out = items;
    return count;
}

static int take_atoms(lua_State *L, const bs_mol *mol, int **out)
{
    int count = (int)lua_rawlen(L, -1);
    int *atoms = lua_newuserdatauv(L, (size_t)(count + 1) * sizeof *atoms, 0);

    for (int i = 0; i < count; i++) {
        lua_rawgeti(L, -2, i + 1);
        atoms[i] = (int)lua_tointeger(L, -1) - 1;
        luaL_argcheck(L, atoms[i] >= 0 && atoms[i] < bs_mol_atom_count(mol), 2,
                      "a stereo group names an atom that is not there");
        lua_pop(L, 1);
    }
    *out = atoms;
    return count;
}

/* The stereo groups of the table on top, as bsl_push_record() makes them. */
static int take_groups(lua_State *L, const bs_mol *mol, bs_stereo_group **out)
{
    static const char *const kinds[] = {"absolute", "relative", "racemic"};
    int list = lua_gettop(L), count = lua_istable(L, list) ? (int)lua_rawlen(L, list) : 0;
    bs_stereo_group *groups = lua_newuserdatauv(L, (size_t)(count + 1) * sizeof *groups, 0);

    *out = groups;
    for (int i = 0; i < count; i++) {
        const char *kind;
        int *atoms;

        luaL_checkstack(L, 6, "stereo groups");
        lua_rawgeti(L, list, i + 1);
        luaL_argcheck(L, lua_istable(L, -1), 2, "a stereo group is a table");
        groups[i] = (bs_stereo_group){.kind = BS_STEREO_GROUP_ABSOLUTE};
        lua_getfield(L, -1, "kind");
        kind = lua_tostring(L, -1);
        for (int k = 0; k < 3 && kind; k++) {
            if (strcmp(kind, kinds[k]) == 0)
                groups[i].kind = (bs_stereo_group_kind)k;
        }
        lua_getfield(L, -2, "number");
        groups[i].number = (int)lua_tointeger(L, -1);
        lua_pop(L, 2);
        lua_getfield(L, -1, "atoms");
        luaL_argcheck(L, lua_istable(L, -1), 2, "a stereo group has a list of atoms");
        groups[i].atom_count = take_atoms(L, mol, &atoms);
        groups[i].atoms = atoms;
    }
    return count;
}

/*
 * w:write(m [, { name = ..., fields = { ... } }]): the name and the fields of the molecule's own
 * file if none are given. Gives the number of stereo elements that the file cannot hold, if any.
 */
static int writer_write(lua_State *L)
{
    writer_box *box = luaL_checkudata(L, 1, WRITER_TYPE);
    bs_record record = {.mol = bsl_checkmol(L, 2)};
    bs_stereo_group *groups;
    bs_field *fields;
    int lost = 0;

    lua_settop(L, 3);
    if (!lua_isnil(L, 3))
        luaL_checktype(L, 3, LUA_TTABLE);
    if (!box->writer)
        return bsl_error(L, BS_EVALUE, "the file is closed");
    lua_getiuservalue(L, 2, BSL_MOL_RECORD); /* 4 */
    lua_newtable(L);                         /* 5: keeps texts */
    if (push_part(L, 3, "name") == LUA_TNIL)
        push_part(L, 4, "name");
    record.name = lua_tolstring(L, -1, &record.name_length);
    if (push_part(L, 3, "fields") == LUA_TNIL)
        push_part(L, 4, "fields");
    lua_pushvalue(L, 5);
    lua_replace(L, 3);
    record.field_count = take_fields(L, &fields);
    record.fields = fields;
    push_part(L, 4, "stereo_groups");
    record.group_count = take_groups(L, record.mol, &groups);
    record.groups = groups;
    if (!record.name)
        record.name = "";
    if (bs_file_put(box->writer, &record, &lost) != BS_OK)
        return raise_own(L, box);
    if (lost == 0)
        return 0;
    lua_pushinteger(L, lost);
    return 1;
}

/* w:close(): the file is there from now on */
static int writer_close(lua_State *L)
{
    writer_box *box = luaL_checkudata(L, 1, WRITER_TYPE);
    bs_file_writer *writer = box->writer;

    box->writer = NULL;
    if (writer && bs_file_finish(writer) != BS_OK)
        return raise_own(L, box);
    return 0;
}

/* At the end of its block: closed, or dropped if there was an error. */
static int writer_leave(lua_State *L)
{
    if (lua_isnoneornil(L, 2))
        return writer_close(L);
    drop(luaL_checkudata(L, 1, WRITER_TYPE));
    return 0;
}

static int writer_gc(lua_State *L)
{
    drop(luaL_checkudata(L, 1, WRITER_TYPE));
    return 0;
}

void bsl_open_writer(lua_State *L)
{
    static const luaL_Reg methods[] = {
        {"write", writer_write},
        {"close", writer_close},
        {NULL, NULL},
    };
    static const luaL_Reg meta[] = {
        {"__gc", writer_gc},
        {"__close", writer_leave},
        {NULL, NULL},
    };

    bsl_new_type(L, WRITER_TYPE, methods, meta);
    lua_pushcfunction(L, core_create_molecules);
    lua_setfield(L, -2, "create_molecules");
}
