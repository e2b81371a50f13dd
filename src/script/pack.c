/*
 * Packs: finding them by file or by name, and reading them in the pack state.
 *
 * A name is never a path: it is made of letters, digits, hyphens, underscores and dots, does not
 * begin with a dot, and is looked up as NAME.lua in the folders of the session. Only the user's
 * own code may name files.
 */
#include "script/host.h"

#include <dirent.h>
#include <limits.h>
#include <stdio.h>
#include <stdlib.h>
#include <string.h>
#include <sys/stat.h>

#define PACK_SIZE_LIMIT ((size_t)8 << 20)
#define PACK_BUDGET 20000000L
#define PACK_LIMIT 4096
#define LIBRARY_LIMIT 1000

static bs_status fault_of_error(const bs_ctx *cx, bsl_fault *fault)
{
    *fault = (bsl_fault){ .code = cx->error.code };
    snprintf(fault->message, sizeof fault->message, "%s", cx->error.message);
    return fault->code;
}

static bs_status fail(bsl_fault *fault, bs_status code, const char *format, const char *what)
{
    char shown[200];

    *fault = (bsl_fault){ .code = code };
    bsl_printable(what, strlen(what), shown, sizeof shown);
    snprintf(fault->message, sizeof fault->message, format, shown);
    return code;
}

static bool is_file(const char *path)
{
    struct stat st;

    return stat(path, &st) == 0 && S_ISREG(st.st_mode);
}

/* ---- Finding --------------------------------------------------------------------------- */

static bool is_pack_name(const char *name)
{
    size_t length = strlen(name);

    if (length == 0 || length > 100 || name[0] == '.')
        return false;
    return strspn(name, "abcdefghijklmnopqrstuvwxyzABCDEFGHIJKLMNOPQRSTUVWXYZ0123456789-_.") ==
           length;
}

/* Is this a file (it has a slash, or ends in .lua) rather than a name? */
static bool looks_like_path(const char *name)
{
    size_t length = strlen(name);

    return strchr(name, '/') || (length > 4 && strcmp(name + length - 4, ".lua") == 0);
}

static bs_status find_path(bs_session *session, const char *name, char *out, size_t size,
                           bsl_fault *fault)
{
    const char *folder = session->opts.script_folder;

    if ((size_t)snprintf(out, size, "%s", name) < size && is_file(out))
        return BS_OK;
    if (folder && name[0] != '/' && (size_t)snprintf(out, size, "%s/%s", folder, name) < size &&
        is_file(out))
        return BS_OK;
    return fail(fault, BS_EFILE, "no pack in file '%s'", name);
}

static bs_status find_name(bs_session *session, const char *name, char *out, size_t size,
                           bsl_fault *fault)
{
    if (!is_pack_name(name))
        return fail(fault, BS_EVALUE,
                    "'%s' is no name of a pack; letters, digits, '-', '_' and '.' are expected",
                    name);
    for (const char *folder = session->folders; *folder; folder += strlen(folder) + 1)
        if ((size_t)snprintf(out, size, "%s/%s.lua", folder, name) < size && is_file(out))
            return BS_OK;
    return fail(fault, BS_ENOTFOUND,
                "no pack '%s' beside the script, on BACKSAW_PATH or in the standard library", name);
}

/* The pack that was read from this file, or -1. */
static int find_loaded(const bs_session *session, const char *path)
{
    for (int i = 1; i < session->pack_count; i++)
        if (session->pack_list[i].path && strcmp(session->pack_list[i].path, path) == 0)
            return i;
    return -1;
}

/* ---- Reading --------------------------------------------------------------------------- */

/* Pushes the chunk of a pack with an environment of its own. Runs protected: text, length, name. */
static int load_chunk(lua_State *L)
{
    const char *text = lua_touserdata(L, 1);
    size_t length = (size_t)lua_tointeger(L, 2);

    if (luaL_loadbufferx(L, text, length, lua_tostring(L, 3), "t") != LUA_OK)
        return lua_error(L);
    bsl_push_module(L, "sandbox");
    lua_getfield(L, -1, "environment");
    lua_call(L, 0, 1);
    if (!lua_setupvalue(L, -3, 1))
        lua_pop(L, 1);
    lua_pushvalue(L, -2);
    return 1;
}

/* Reads and runs the text of pack number `pack`. */
static bs_status run_pack(bsl_host *host, const char *shown, const char *text, size_t length,
                          bsl_fault *fault)
{
    char chunk[PATH_MAX + 2];
    lua_State *L = host->L;
    int status;

    snprintf(chunk, sizeof chunk, "@%s", shown);
    host->breach = NULL;
    lua_checkstack(L, 10);
    lua_pushcfunction(L, load_chunk);
    lua_pushlightuserdata(L, (void *)text);
    lua_pushinteger(L, (lua_Integer)length);
    lua_pushstring(L, chunk);
    status = bsl_call(host, L, 3, 1, PACK_BUDGET);
    if (status == LUA_OK)
        status = bsl_call(host, L, 0, 0, PACK_BUDGET);
    if (status == LUA_OK)
        return BS_OK;
    bsl_take_fault(L, fault);
    if (status == LUA_ERRMEM)
        fail(fault, host->breach ? BS_ELIMIT : BS_ENOMEM, "%s",
             host->breach ? host->breach : "out of memory");
    if (!fault->where[0] && !strstr(fault->message, ".lua:"))
        snprintf(fault->where, sizeof fault->where, "%s", shown);
    return fault->code == BS_OK ? BS_ESCRIPT : fault->code;
}

/* Adds a record with the file's base name as name; its number in *pack. */
static bs_status add_record(bs_session *session, const char *path, const char *shown, int *pack)
{
    bs_ctx *cx = &session->cx;
    const char *base = strrchr(path, '/') ? strrchr(path, '/') + 1 : path;
    size_t length = strlen(base);
    bsl_pack *record;
    char *copy;

    if (session->pack_count == PACK_LIMIT)
        return bs_fail(cx, BS_ELIMIT, "more than %d packs", PACK_LIMIT - 1);
    if (session->pack_count == session->pack_room) {
        int room = session->pack_room ? session->pack_room * 2 : 64;
        bsl_pack *list = bs_gate_resize(cx->gate, session->pack_list,
                                        sizeof *list * (size_t)session->pack_room,
                                        sizeof *list * (size_t)room);

        if (!list)
            return bs_fail_memory(cx);
        session->pack_list = list;
        session->pack_room = room;
    }
    record = &session->pack_list[session->pack_count];
    *record = (bsl_pack){ 0 };
    if (length > 4 && strcmp(base + length - 4, ".lua") == 0)
        length -= 4;
    if (bs_copy_text(cx, &session->home, path, strlen(path), &copy) != BS_OK)
        return cx->error.code;
    record->path = copy;
    if (bs_copy_text(cx, &session->home, shown, strlen(shown), &copy) != BS_OK)
        return cx->error.code;
    record->shown = copy;
    if (bs_copy_text(cx, &session->home, base, length, &copy) != BS_OK)
        return cx->error.code;
    record->name = copy;
    *pack = session->pack_count++;
    return BS_OK;
}

/* Keeps the text of a pack with functions, for lanes. */
static bs_status keep_text(bs_session *session, int pack, const char *text, size_t length,
                           bsl_fault *fault)
{
    char *copy;

    if (bs_copy_text(&session->cx, &session->home, text, length, &copy) != BS_OK)
        return fault_of_error(&session->cx, fault);
    session->pack_list[pack].text = copy;
    session->pack_list[pack].length = length;
    return BS_OK;
}

/* Forgets what a pack that failed, and the packs that it needed, have defined. */
static void forget(bs_session *session, int pack, bs_rules_mark grown)
{
    bsl_example **link = &session->examples;

    bs_rules_rewind(session->rules, grown);
    for (int i = pack; i < session->pack_count; i++) {
        session->pack_list[i].path = NULL;
        session->pack_list[i].done = false;
    }
    while (*link && (*link)->transform < grown.transforms)
        link = &(*link)->next;
    *link = NULL;
    session->examples_end = link;
}

/* Loads the file `path`, known to messages as `shown`, into the pack state. */
static bs_status load_pack(bs_session *session, const char *path, const char *shown, int *pack,
                           bsl_fault *fault)
{
    bsl_host *host = session->packs;
    bs_mark mark = bs_arena_mark(&host->results);
    int outer = host->pack, outer_hook = host->hook_next;
    bs_rules_mark grown = bs_rules_grown(session->rules);
    bs_status st = BS_OK;
    char *text;
    size_t length;

    if (add_record(session, path, shown, pack) != BS_OK ||
        bs_read_file(&session->cx, &host->results, path, PACK_SIZE_LIMIT, &text, &length) != BS_OK) {
        bs_arena_rewind(&host->results, mark);
        return fault_of_error(&session->cx, fault);
    }
    if (memchr(text, '\0', length) || text[0] == '\033') {
        st = fail(fault, BS_ESYNTAX, "%s: this is no text; a pack in Lua is expected", shown);
    } else {
        host->pack = *pack;
        host->hook_next = 0;
        if (outer == 0)
            host->grown_from = atomic_load(&session->cx.gate->used);
        st = run_pack(host, shown, text, length, fault);
        host->pack = outer;
        host->hook_next = outer_hook;
    }
    if (st == BS_OK && session->pack_list[*pack].hooked)
        st = keep_text(session, *pack, text, length, fault);
    bs_arena_rewind(&host->results, mark);
    if (st == BS_OK)
        session->pack_list[*pack].done = true;
    else
        forget(session, *pack, grown);
    return st;
}

bs_status bsl_replay(bsl_host *lane, bs_ctx *cx, int pack, bsl_fault *fault)
{
    const bsl_pack *record = &lane->session->pack_list[pack];
    bs_ctx *kept = lane->cx;
    bs_status st;

    if (!record->text)
        return fail(fault, BS_EBUG, "the text of pack '%s' was not kept", record->name);
    lane->cx = cx;
    lane->pack = pack;
    lane->hook_next = 0;
    st = run_pack(lane, record->shown, record->text, record->length, fault);
    lane->cx = kept;
    return st;
}

bs_status bsl_use(bs_session *session, const char *name, bool names_only, int *pack,
                  bsl_fault *fault)
{
    char path[PATH_MAX], real[PATH_MAX];
    bs_status st;

    if (!names_only && looks_like_path(name))
        st = find_path(session, name, path, sizeof path, fault);
    else
        st = find_name(session, name, path, sizeof path, fault);
    if (st != BS_OK)
        return st;
    if (!realpath(path, real))
        return fail(fault, BS_EFILE, "no pack in file '%s'", path);
    *pack = find_loaded(session, real);
    if (*pack >= 0) {
        if (!session->pack_list[*pack].done)
            return fail(fault, BS_EVALUE, "pack '%s' needs itself", name);
        return BS_OK;
    }
    return load_pack(session, real, path, pack, fault);
}

/* ---- The standard library -------------------------------------------------------------- */

static int by_name(const void *a, const void *b)
{
    return strcmp(*(char *const *)a, *(char *const *)b);
}

/* Lists the names of packs in a folder, sorted, in the arena. */
static bs_status list_packs(bs_session *session, bs_arena *home, const char *folder, char ***names,
                            int *count)
{
    bs_ctx *cx = &session->cx;
    DIR *dir = opendir(folder);
    const struct dirent *entry;
    bs_status st;

    *count = 0;
    if (!dir)
        return bs_fail(cx, BS_EFILE, "cannot read the folder of the standard library '%s'", folder);
    st = bs_new(cx, home, LIBRARY_LIMIT, names);
    while (st == BS_OK && *count < LIBRARY_LIMIT && (entry = readdir(dir))) {
        size_t length = strlen(entry->d_name);

        if (length <= 4 || strcmp(entry->d_name + length - 4, ".lua") != 0 ||
            entry->d_name[0] == '.')
            continue;
        st = bs_copy_text(cx, home, entry->d_name, length - 4, &(*names)[*count]);
        if (st == BS_OK)
            ++*count;
    }
    closedir(dir);
    if (st == BS_OK)
        qsort(*names, (size_t)*count, sizeof **names, by_name);
    return st;
}

bs_status bsl_use_library(bs_session *session, bsl_fault *fault)
{
    bs_arena names_home;
    char path[PATH_MAX];
    char **names;
    int count, pack;
    bs_status st = BS_OK;

    if (!session->library)
        return BS_OK;
    bs_arena_init(&names_home, session->cx.gate);
    if (list_packs(session, &names_home, session->library, &names, &count) != BS_OK) {
        bs_arena_free(&names_home);
        return fault_of_error(&session->cx, fault);
    }
    for (int i = 0; i < count && st == BS_OK; i++) {
        snprintf(path, sizeof path, "%s/%s.lua", session->library, names[i]);
        st = bsl_use(session, path, false, &pack, fault);
    }
    bs_arena_free(&names_home);
    return st;
}

/* ---- Primitives ------------------------------------------------------------------------ */

/* number = core.use(name): the number of the pack; files only from the user's own code */
static int core_use(lua_State *L)
{
    bsl_host *host = bsl_host_of(L);
    const char *name = luaL_checkstring(L, 1);
    bsl_fault fault;
    int pack;

    luaL_argcheck(L, strlen(name) == lua_rawlen(L, 1), 1, "a NUL byte in the name of a pack");
    if (host->kind == BSL_LANE)
        return 0;
    if (bsl_use(host->session, name, host->kind != BSL_MAIN, &pack, &fault) != BS_OK) {
        if (!fault.where[0] && fault.code != BS_ESCRIPT && fault.code != BS_ESYNTAX)
            bsl_where(L, fault.where, sizeof fault.where);
        return bsl_raise_fault(L, &fault);
    }
    lua_pushinteger(L, pack);
    return 1;
}

/* core.header{ name=, version=, about= } of the pack that is being read */
static int core_header(lua_State *L)
{
    bsl_host *host = bsl_host_of(L);
    bs_session *session = host->session;
    const char *field[3] = { NULL, NULL, NULL };
    static const char *const names[3] = { "name", "version", "about" };

    luaL_checktype(L, 1, LUA_TTABLE);
    if (host->kind != BSL_PACKS || host->pack == 0)
        return 0;
    for (int i = 0; i < 3; i++) {
        size_t length;
        const char *text;

        if (lua_getfield(L, 1, names[i]) == LUA_TSTRING) {
            text = lua_tolstring(L, -1, &length);
            field[i] = bsl_keep(L, text, length);
        }
        lua_pop(L, 1);
    }
    for (int i = 1; i < session->pack_count; i++)
        if (i != host->pack && session->pack_list[i].path && field[0] &&
            strcmp(session->pack_list[i].name, field[0]) == 0)
            return bsl_error(L, BS_EVALUE, "a pack named '%s' is already in use", field[0]);
    if (field[0])
        session->pack_list[host->pack].name = field[0];
    session->pack_list[host->pack].version = field[1];
    session->pack_list[host->pack].about = field[2];
    return 0;
}

/* list = core.packs(): { name=, version=, about=, path= } of each pack in use; [0] is none */
static int core_packs(lua_State *L)
{
    const bs_session *session = bsl_host_of(L)->session;
    int n = 0;

    lua_newtable(L);
    for (int i = 1; i < session->pack_count; i++) {
        const bsl_pack *pack = &session->pack_list[i];

        if (!pack->done)
            continue;
        lua_createtable(L, 0, 5);
        lua_pushstring(L, pack->name);
        lua_setfield(L, -2, "name");
        lua_pushstring(L, pack->version);
        lua_setfield(L, -2, "version");
        lua_pushstring(L, pack->about);
        lua_setfield(L, -2, "about");
        lua_pushstring(L, pack->path);
        lua_setfield(L, -2, "path");
        lua_pushinteger(L, i);
        lua_setfield(L, -2, "number");
        lua_rawseti(L, -2, ++n);
    }
    return 1;
}

/* core.say(text): a line from a pack on standard error, escaped, 1 MiB a session at most */
static int core_say(lua_State *L)
{
    bsl_host *host = bsl_host_of(L);
    char line[1000];
    size_t length;
    const char *text = luaL_checklstring(L, 1, &length);

    bsl_printable(text, length, line, sizeof line);
    host->said += strlen(line) + 1;
    if (host->said > ((size_t)1 << 20))
        return bsl_error(L, BS_ELIMIT, "packs have printed more than 1 MiB");
    if (host->session->opts.say && host->kind != BSL_LANE)
        host->session->opts.say(host->session->opts.payload, line);
    return 0;
}

void bsl_open_pack(lua_State *L)
{
    static const luaL_Reg functions[] = {
        { "use", core_use },     { "header", core_header }, { "packs", core_packs },
        { "say", core_say },     { NULL, NULL },
    };

    luaL_setfuncs(L, functions, 0);
}
