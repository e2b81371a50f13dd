/*
 * Sessions: making one, and running code of the user's in it. This is the face of the layer for
 * programs that know no Lua.
 */
#include "script/host.h"

#include <limits.h>
#include <stdio.h>
#include <stdlib.h>
#include <string.h>
#include <sys/stat.h>

#define SCRIPT_SIZE_LIMIT ((size_t)64 << 20)

/* ---- Life ------------------------------------------------------------------------------ */

static bool is_folder(const char *path)
{
    struct stat st;

    return stat(path, &st) == 0 && S_ISDIR(st.st_mode);
}

/* The folder of the standard library: installed, or in the source tree around the build. */
static bs_status find_library(bs_session *session)
{
    static const char *const places[] = { "../share/backsaw/stdlib", "../../stdlib", "stdlib" };
    const char *program = session->opts.program_folder;
    char path[PATH_MAX], real[PATH_MAX];

    for (size_t i = 0; program && i < sizeof places / sizeof *places; i++) {
        if ((size_t)snprintf(path, sizeof path, "%s/%s", program, places[i]) >= sizeof path ||
            !is_folder(path) || !realpath(path, real))
            continue;
        return bs_copy_text(&session->cx, &session->home, real, strlen(real), &session->library);
    }
    return BS_OK;
}

/* Adds a folder to the list that is being written at *at. */
static void add_folder(char **at, const char *folder, size_t length)
{
    if (length == 0)
        return;
    memcpy(*at, folder, length);
    (*at)[length] = '\0';
    *at += length + 1;
}

/* Beside the script (or here), then BACKSAW_PATH, then the standard library. */
static bs_status list_folders(bs_session *session)
{
    const char *script = session->opts.script_folder ? session->opts.script_folder : ".";
    const char *path = session->opts.pack_path ? session->opts.pack_path : "";
    const char *library = session->library ? session->library : "";
    size_t room = strlen(script) + strlen(path) + strlen(library) + 8;
    char *at;

    if (bs_new(&session->cx, &session->home, room, &session->folders) != BS_OK)
        return session->cx.error.code;
    at = session->folders;
    add_folder(&at, script, strlen(script));
    while (*path) {
        size_t length = strcspn(path, ":");

        add_folder(&at, path, length);
        path += length + (path[length] == ':');
    }
    add_folder(&at, library, strlen(library));
    *at = '\0';
    return BS_OK;
}

/* The first entry of the list of packs stands for the user's own code. */
static bs_status begin_packs(bs_session *session)
{
    session->pack_room = 64;
    session->pack_list = bs_gate_alloc(session->cx.gate, sizeof(bsl_pack) * 64);
    if (!session->pack_list)
        return bs_fail_memory(&session->cx);
    session->pack_list[0].name = "your own";
    session->pack_count = 1;
    return BS_OK;
}

static bs_status keep_fault(bs_session *session, const bsl_fault *fault)
{
    bs_text_clear(&session->message);
    bs_text_printf(&session->message, "%s%s%s%s%s", fault->where, fault->where[0] ? ": " : "",
                   fault->message, fault->caret[0] ? "\n" : "", fault->caret);
    return fault->code == BS_OK ? BS_ESCRIPT : fault->code;
}

static bs_status keep_error(bs_session *session)
{
    bs_text_clear(&session->message);
    bs_text_puts(&session->message, session->cx.error.message);
    return session->cx.error.code;
}

bs_status bs_session_new(const bs_session_opts *opts, bs_session **out)
{
    bs_session *session = calloc(1, sizeof *session);
    bsl_fault fault;

    *out = session;
    if (!session)
        return BS_ENOMEM;
    bs_ctx_init(&session->cx, NULL);
    bs_arena_init(&session->home, session->cx.gate);
    bs_text_init(&session->message, &session->cx);
    session->opts = *opts;
    session->examples_end = &session->examples;
    if (begin_packs(session) != BS_OK || find_library(session) != BS_OK ||
        list_folders(session) != BS_OK || bs_rules_new(&session->cx, &session->rules) != BS_OK ||
        bsl_host_new(session, &session->cx, BSL_PACKS, &session->packs) != BS_OK ||
        bsl_host_new(session, &session->cx, BSL_MAIN, &session->main) != BS_OK)
        return keep_error(session);
    if (!opts->bare && !opts->later && bsl_use_library(session, &fault) != BS_OK)
        return keep_fault(session, &fault);
    return BS_OK;
}

void bs_session_free(bs_session *session)
{
    if (!session)
        return;
    bsl_host_free(session->main);
    bsl_host_free(session->packs);
    bs_rules_free(session->rules);
    bs_text_free(&session->message);
    bs_gate_free(session->cx.gate, session->pack_list, sizeof(bsl_pack) * (size_t)session->pack_room);
    bs_arena_free(&session->home);
    bs_ctx_free(&session->cx);
    free(session);
}

const char *bs_session_message(const bs_session *session)
{
    return session->message.data ? session->message.data : "out of memory";
}

void bs_session_interrupt(bs_session *session)
{
    atomic_store(&session->cx.own_stop, true);
    if (session->main)
        bsl_interrupt(session->main);
}

/* ---- Running --------------------------------------------------------------------------- */

/* A call of the user's, handed to the protected part as a light userdata. */
typedef struct bsl_job {
    bs_session *session;
    const char *name;
    const char *text;
    size_t length;
    int count;
    char *const *arguments;
    int exit_status;
    bool incomplete;
    bs_arena *home;
    char **names;
} bsl_job;

/* Runs a protected job on the main state and keeps the message of its failure. */
static bs_status run_job(bs_session *session, lua_CFunction function, bsl_job *job)
{
    lua_State *L = session->main->L;
    bsl_fault fault;
    int status;

    job->session = session;
    lua_settop(L, 0);
    lua_pushcfunction(L, function);
    lua_pushlightuserdata(L, job);
    status = bsl_call(session->main, L, 1, 0, 0);
    atomic_store(&session->cx.own_stop, false);
    bsl_calm(session->main);
    if (status == LUA_OK)
        return BS_OK;
    bsl_take_fault(L, &fault);
    return keep_fault(session, &fault);
}

static int job_arguments(lua_State *L)
{
    const bsl_job *job = lua_touserdata(L, 1);

    lua_createtable(L, job->count, 1);
    lua_pushstring(L, job->name);
    lua_rawseti(L, -2, 0);
    for (int i = 0; i < job->count; i++) {
        lua_pushstring(L, job->arguments[i]);
        lua_rawseti(L, -2, i + 1);
    }
    lua_setglobal(L, "arg");
    return 0;
}

bs_status bs_session_arguments(bs_session *session, const char *script, int count,
                               char *const *arguments)
{
    bsl_job job = { .name = script, .count = count, .arguments = arguments };

    return run_job(session, job_arguments, &job);
}

/* Pushes the values of the global `arg` and returns how many. */
static int push_arguments(lua_State *L)
{
    int count = 0;

    if (lua_getglobal(L, "arg") != LUA_TTABLE) {
        lua_pop(L, 1);
        return 0;
    }
    count = (int)lua_rawlen(L, -1);
    luaL_checkstack(L, count + 4, "arguments");
    for (int i = 1; i <= count; i++)
        lua_rawgeti(L, -i, i);
    lua_remove(L, -count - 1);
    return count;
}

static int job_run(lua_State *L)
{
    const bsl_job *job = lua_touserdata(L, 1);

    if (luaL_loadbufferx(L, job->text, job->length, job->name, "t") != LUA_OK)
        return lua_error(L);
    lua_call(L, push_arguments(L), 0);
    return 0;
}

bs_status bs_session_run_text(bs_session *session, const char *name, const char *text,
                              size_t length)
{
    bsl_job job = { .name = name, .text = text, .length = length };

    return run_job(session, job_run, &job);
}

/* Reads all of standard input. */
static bs_status read_input(bs_session *session, bs_text *text)
{
    char block[8192];
    size_t got;

    while ((got = fread(block, 1, sizeof block, stdin)) > 0) {
        if (text->length + got > SCRIPT_SIZE_LIMIT)
            return bs_fail(&session->cx, BS_ELIMIT, "standard input is larger than 64 MiB");
        if (bs_text_add(text, block, got) != BS_OK)
            return session->cx.error.code;
    }
    if (ferror(stdin))
        return bs_fail(&session->cx, BS_EFILE, "standard input cannot be read");
    return BS_OK;
}

/* The length of a first line that starts with #, which is for the shell; the newline stays. */
static size_t first_line(const char *text, size_t length)
{
    const char *end;

    if (length == 0 || text[0] != '#')
        return 0;
    end = memchr(text, '\n', length);
    return end ? (size_t)(end - text) : length;
}

bs_status bs_session_run_file(bs_session *session, const char *path)
{
    char name[4100];
    bs_arena home;
    bs_text input;
    char *text = NULL;
    size_t length = 0, skip;
    bs_status st;

    bs_arena_init(&home, session->cx.gate);
    bs_text_init(&input, &session->cx);
    if (path) {
        st = bs_read_file(&session->cx, &home, path, SCRIPT_SIZE_LIMIT, &text, &length);
    } else {
        st = read_input(session, &input);
        text = input.data;
        length = input.length;
    }
    if (st != BS_OK) {
        st = keep_error(session);
    } else if (length > 0) {
        skip = first_line(text, length);
        snprintf(name, sizeof name, path ? "@%s" : "=%s", path ? path : "stdin");
        st = bs_session_run_text(session, name, text + skip, length - skip);
    }
    bs_text_free(&input);
    bs_arena_free(&home);
    return st;
}

/* ---- The prompt ------------------------------------------------------------------------ */

/* Does the message of the parser say that the text ended too early? */
static bool ends_early(lua_State *L)
{
    size_t length;
    const char *message = lua_tolstring(L, -1, &length);

    return message && length >= 5 && strcmp(message + length - 5, "<eof>") == 0;
}

/* Pushes the chunk for what was typed: as an expression if it is one, else as statements. */
static bool load_entry(lua_State *L, bsl_job *job)
{
    bool early;
    int status;

    lua_pushliteral(L, "return ");
    lua_pushlstring(L, job->text, job->length);
    lua_concat(L, 2);
    if (luaL_loadbufferx(L, lua_tostring(L, -1), lua_rawlen(L, -1), "=prompt", "t") == LUA_OK)
        return true;
    early = ends_early(L);
    lua_settop(L, 1);
    status = luaL_loadbufferx(L, job->text, job->length, "=prompt", "t");
    if (status == LUA_OK)
        return true;
    if (status == LUA_ERRSYNTAX && (early || ends_early(L))) {
        job->incomplete = true;
        return false;
    }
    return lua_error(L);
}

static int job_enter(lua_State *L)
{
    bsl_job *job = lua_touserdata(L, 1);
    int base;

    if (!load_entry(L, job))
        return 0;
    base = lua_gettop(L) - 1;
    lua_call(L, 0, LUA_MULTRET);
    if (lua_gettop(L) == base)
        return 0;
    bsl_push_module(L, "prompt");
    lua_getfield(L, -1, "show");
    lua_insert(L, base + 1);
    lua_pop(L, 1);
    lua_call(L, lua_gettop(L) - base - 1, 0);
    return 0;
}

bs_status bs_session_enter(bs_session *session, const char *text, size_t length, bool *incomplete)
{
    bsl_job job = { .text = text, .length = length };
    bs_status st = run_job(session, job_enter, &job);

    *incomplete = job.incomplete;
    return st;
}

static int job_complete(lua_State *L)
{
    bsl_job *job = lua_touserdata(L, 1);
    bs_ctx *cx = &job->session->cx;

    bsl_push_module(L, "prompt");
    lua_getfield(L, -1, "complete");
    lua_pushstring(L, job->text);
    lua_call(L, 1, 1);
    luaL_checktype(L, -1, LUA_TTABLE);
    job->count = (int)lua_rawlen(L, -1);
    if (bs_new(cx, job->home, job->count + 1, &job->names) != BS_OK)
        return bsl_raise(L, NULL, 0);
    for (int i = 0; i < job->count; i++) {
        size_t length;
        const char *name;

        lua_rawgeti(L, -1, i + 1);
        name = luaL_checklstring(L, -1, &length);
        if (bs_copy_text(cx, job->home, name, length, &job->names[i]) != BS_OK)
            return bsl_raise(L, NULL, 0);
        lua_pop(L, 1);
    }
    return 0;
}

bs_status bs_session_complete(bs_session *session, bs_arena *home, const char *prefix,
                              char ***names, int *count)
{
    bsl_job job = { .text = prefix, .home = home };
    bs_status st = run_job(session, job_complete, &job);

    *names = job.names;
    *count = st == BS_OK ? job.count : 0;
    return st;
}

/* ---- Packs and commands ---------------------------------------------------------------- */

bs_status bs_session_use(bs_session *session, const char *pack)
{
    bsl_fault fault;
    int number;

    if (bsl_use(session, pack, false, &number, &fault) != BS_OK)
        return keep_fault(session, &fault);
    return BS_OK;
}

static int job_command(lua_State *L)
{
    bsl_job *job = lua_touserdata(L, 1);

    bsl_open_study(L);
    bsl_push_module(L, job->name);
    luaL_checkstack(L, job->count + 4, "arguments");
    for (int i = 0; i < job->count; i++)
        lua_pushstring(L, job->arguments[i]);
    lua_call(L, job->count, 1);
    job->exit_status = (int)luaL_optinteger(L, -1, 0);
    return 0;
}

bs_status bs_session_command(bs_session *session, const char *name, int count,
                             char *const *arguments, int *exit_status)
{
    char module[64];
    bsl_job job = { .name = module, .count = count, .arguments = arguments };
    bs_status st;

    snprintf(module, sizeof module, "command_%s", name);
    st = run_job(session, job_command, &job);
    *exit_status = job.exit_status;
    return st;
}
