/*
 * Files of molecules in Lua: an open file that gives one molecule after the other, and molfiles as
 * texts. Only scripts have them; packs read and write nothing.
 *
 * The box has a context of its own: it may be read in calls that come with different ones.
 */
#include "script/host.h"

#include <stdio.h>
#include <string.h>

#define FILE_TYPE "backsaw.file"

typedef struct file_box {
    bs_ctx cx;
    bs_file *file; /* NULL once closed */
} file_box;

static void close_box(file_box *box)
{
    bs_file_close(box->file);
    box->file = NULL;
    bs_arena_free(&box->cx.scratch);
}

/* What went wrong, with the file and the record where the error is one of the text. */
static void make_fault(lua_State *L, int i, const file_box *box, bsl_fault *fault)
{
    const bs_error *error = &box->cx.error;
    bool of_text = error->code == BS_ESYNTAX || error->code == BS_EVALUE || error->line > 0;
    char shown[150], place[60];
    const char *path;
    size_t length;

    *fault = (bsl_fault){.code = error->code, .line = error->line};
    bsl_where(L, fault->where, sizeof fault->where);
    if (!of_text || !box->file) {
        snprintf(fault->message, sizeof fault->message, "%s", error->message);
        return;
    }
    lua_getiuservalue(L, i, 1);
    path = lua_tolstring(L, -1, &length);
    bsl_printable(path, length, shown, sizeof shown);
    lua_pop(L, 1);
    if (error->line > 0)
        snprintf(place, sizeof place, "record %ld", bs_file_record_number(box->file));
    else
        snprintf(place, sizeof place, "record %ld from line %ld on",
                 bs_file_record_number(box->file), bs_file_record_line(box->file));
    snprintf(fault->message, sizeof fault->message, "%s: %s, %.180s", shown, place, error->message);
}

/* f = core.open_molecules(path) */
static int core_open_molecules(lua_State *L)
{
    const bs_session *session = bsl_host_of(L)->session;
    const char *path = luaL_checkstring(L, 1);
    file_box *box = lua_newuserdatauv(L, sizeof *box, 1);
    bsl_fault fault;

    bs_ctx_init(&box->cx, session->cx.gate);
    box->cx.stop = session->cx.stop;
    box->file = NULL;
    luaL_setmetatable(L, FILE_TYPE);
    lua_pushvalue(L, 1);
    lua_setiuservalue(L, -2, 1);
    if (bs_file_open(&box->cx, path, NULL, &box->file) != BS_OK) {
        box->file = NULL;
        make_fault(L, lua_gettop(L), box, &fault);
        return bsl_raise_fault(L, &fault);
    }
    return 1;
}

/*
 * Pushes the fields of a record: under their names, and the names in the order of the file as a
 * list. Of a name that comes twice the last value stands.
 */
static void push_fields(lua_State *L, const bs_record *record)
{
    int count = 0;

    lua_createtable(L, 0, record->field_count);
    for (int i = 0; i < record->field_count; i++) {
        const bs_field *field = &record->fields[i];

        lua_pushlstring(L, field->name, field->name_length);
        lua_pushvalue(L, -1);
        if (lua_rawget(L, -3) == LUA_TNIL) {
            lua_pushvalue(L, -2);
            lua_rawseti(L, -4, ++count);
        }
        lua_pop(L, 1);
        lua_pushlstring(L, field->value, field->value_length);
        lua_rawset(L, -3);
    }
}

/* Pushes a list of what the stereo groups say that the molecule does not: mixtures and the like. */
static void push_doubts(lua_State *L, const bs_record *record)
{
    int count = 0;

    lua_newtable(L);
    for (int i = 0; i < record->group_count; i++) {
        const bs_stereo_group *group = &record->groups[i];
        luaL_Buffer text;

        if (group->kind == BS_STEREO_GROUP_ABSOLUTE || group->atom_count == 0)
            continue;
        luaL_buffinit(L, &text);
        luaL_addstring(&text, group->atom_count == 1 ? "atom" : "atoms");
        for (int k = 0; k < group->atom_count; k++) {
            lua_pushfstring(L, "%s %d", k > 0 ? "," : "", group->atoms[k] + 1);
            luaL_addvalue(&text);
        }
        luaL_addstring(&text, group->kind == BS_STEREO_GROUP_RACEMIC
                                  ? ": a mixture of both configurations in the file, as drawn here"
                                  : ": only relative configuration in the file, as drawn here");
        luaL_pushresult(&text);
        lua_rawseti(L, -2, ++count);
    }
}

/* Pushes the stereo groups: a list of { kind = ..., number = ..., atoms = { ... } }. */
static void push_groups(lua_State *L, const bs_record *record)
{
    static const char *const kinds[] = {"absolute", "relative", "racemic"};

    lua_createtable(L, record->group_count, 0);
    for (int i = 0; i < record->group_count; i++) {
        const bs_stereo_group *group = &record->groups[i];

        lua_createtable(L, 0, 3);
        lua_pushstring(L, kinds[group->kind]);
        lua_setfield(L, -2, "kind");
        lua_pushinteger(L, group->number);
        lua_setfield(L, -2, "number");
        lua_createtable(L, group->atom_count, 0);
        for (int k = 0; k < group->atom_count; k++) {
            lua_pushinteger(L, (lua_Integer)group->atoms[k] + 1);
            lua_rawseti(L, -2, k + 1);
        }
        lua_setfield(L, -2, "atoms");
        lua_rawseti(L, -2, i + 1);
    }
}

static void push_record(lua_State *L, const bs_record *record)
{
    bsl_pushmol(L, record->mol, NULL);
    lua_createtable(L, 0, 4);
    lua_pushlstring(L, record->name, record->name_length);
    lua_setfield(L, -2, "name");
    push_fields(L, record);
    lua_setfield(L, -2, "fields");
    push_groups(L, record);
    lua_setfield(L, -2, "stereo_groups");
    push_doubts(L, record);
    lua_setfield(L, -2, "doubts");
    lua_setiuservalue(L, -2, BSL_MOL_RECORD);
}

/*
 * m = f:next(), nil at the end of the file; false and an error object for a record that cannot be
 * read, if the next call finds the one behind. Other errors are raised and close the file.
 */
static int file_next(lua_State *L)
{
    bsl_host *host = bsl_host_of(L);
    file_box *box = luaL_checkudata(L, 1, FILE_TYPE);
    bs_mark mark = bs_arena_mark(&host->results);
    bs_record *record;
    bsl_fault fault;

    lua_pushnil(L);
    if (!box->file)
        return 1;
    if (bs_file_next(box->file, &host->results, &record) != BS_OK) {
        make_fault(L, 1, box, &fault);
        if (!bs_file_can_go_on(box->file)) {
            close_box(box);
            return bsl_raise_fault(L, &fault);
        }
        lua_pushboolean(L, 0);
        bsl_push_fault(L, &fault);
        return 2;
    }
    if (!record) {
        close_box(box);
        return 1;
    }
    push_record(L, record);
    bs_arena_rewind(&host->results, mark);
    return 1;
}

/* f:close() */
static int file_close(lua_State *L)
{
    close_box(luaL_checkudata(L, 1, FILE_TYPE));
    return 0;
}

/*
 * text = m:molfile(): V2000 where it can hold the molecule, else V3000; m:molfile "V2000" and
 * m:molfile "V3000" want the one. A second result is the number of stereo elements that a molfile
 * cannot hold, if there are such.
 */
static int mol_molfile(lua_State *L)
{
    static const char *const names[] = {"auto", "V2000", "V3000", NULL};
    static const bs_molfile_version versions[] = {BS_MOLFILE_AUTO, BS_MOLFILE_V2000,
                                                  BS_MOLFILE_V3000};
    const bs_mol *mol = bsl_checkmol(L, 1);
    int choice = luaL_checkoption(L, 2, "auto", names), lost = 0;
    const char *name = NULL;
    bs_text text;

    if (lua_getiuservalue(L, 1, BSL_MOL_RECORD) == LUA_TTABLE) {
        lua_pushliteral(L, "name");
        lua_rawget(L, -2);
        name = lua_tostring(L, -1);
    }
    bs_text_init(&text, bsl_host_of(L)->cx);
    if (bs_molfile_write(&text, mol, name ? name : "", versions[choice], &lost) != BS_OK) {
        bs_text_free(&text);
        return bsl_raise(L, NULL, 0);
    }
    bsl_push_text(L, &text);
    if (lost == 0)
        return 1;
    lua_pushinteger(L, lost);
    return 2;
}

void bsl_open_file(lua_State *L)
{
    static const luaL_Reg methods[] = {
        {"next", file_next},
        {"close", file_close},
        {NULL, NULL},
    };
    static const luaL_Reg meta[] = {
        {"__gc", file_close},
        {"__close", file_close},
        {NULL, NULL},
    };

    bsl_new_type(L, FILE_TYPE, methods, meta);
    lua_pushcfunction(L, core_open_molecules);
    lua_setfield(L, -2, "open_molecules");
    lua_getfield(L, -1, "molecule_methods");
    lua_pushcfunction(L, mol_molfile);
    lua_setfield(L, -2, "molfile");
    lua_pop(L, 1);
}
