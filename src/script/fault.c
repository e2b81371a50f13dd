/*
 * Errors on their way: from the library into Lua, out of Lua, and from one state to another.
 */
#include "script/host.h"

#include <stdarg.h>
#include <stdio.h>
#include <string.h>

#define ERROR_TYPE "backsaw.error"

void bsl_where(lua_State *L, char *out, size_t size)
{
    lua_Debug ar;
    int level;

    out[0] = '\0';
    for (level = 0; level < 200 && lua_getstack(L, level, &ar); level++) {
        if (!lua_getinfo(L, "Sl", &ar) || ar.currentline < 1)
            continue;
        if (strncmp(ar.source, "=[backsaw", 9) == 0)
            continue;
        snprintf(out, size, "%s:%d", ar.source[0] == '@' ? ar.source + 1 : ar.short_src,
                 ar.currentline);
        return;
    }
}

void bsl_printable(const char *text, size_t length, char *out, size_t size)
{
    size_t used = 0, i;

    for (i = 0; i < length && used + 5 < size; i++) {
        unsigned char c = (unsigned char)text[i];

        if (c < 32 || c == 127)
            used += (size_t)snprintf(out + used, size - used, "\\x%02X", c);
        else
            out[used++] = (char)c;
    }
    out[used] = '\0';
}

void bsl_push_fault(lua_State *L, const bsl_fault *fault)
{
    lua_createtable(L, 0, 6);
    lua_pushstring(L, bs_status_text(fault->code));
    lua_setfield(L, -2, "code");
    lua_pushstring(L, fault->message);
    lua_setfield(L, -2, "message");
    if (fault->position > 0) {
        lua_pushinteger(L, fault->position);
        lua_setfield(L, -2, "position");
    }
    if (fault->line > 0) {
        lua_pushinteger(L, fault->line);
        lua_setfield(L, -2, "line");
    }
    if (fault->where[0]) {
        lua_pushstring(L, fault->where);
        lua_setfield(L, -2, "where");
    }
    if (fault->caret[0]) {
        lua_pushstring(L, fault->caret);
        lua_setfield(L, -2, "caret");
    }
    luaL_setmetatable(L, ERROR_TYPE);
}

int bsl_raise_fault(lua_State *L, const bsl_fault *fault)
{
    bsl_push_fault(L, fault);
    lua_error(L);
    __builtin_unreachable();
}

int bsl_type_error(lua_State *L, int i, const char *expected)
{
    const char *got = luaL_typename(L, i), *name = NULL;
    bool method = false;
    lua_Debug ar;

    if (lua_type(L, i) == LUA_TNONE)
        got = "nothing";
    else if (luaL_getmetafield(L, i, "__name") == LUA_TSTRING)
        got = lua_tostring(L, -1);
    if (lua_getstack(L, 0, &ar) && lua_getinfo(L, "n", &ar)) {
        name = ar.name;
        method = strcmp(ar.namewhat, "method") == 0;
    }
    if (method && i == 1)
        bsl_error(L, BS_EVALUE, "%s: called on %s; %s expected before the colon", name, got,
                  expected);
    bsl_error(L, BS_EVALUE, "%s%sargument %d: %s expected, got %s", name ? name : "",
              name ? ": " : "", i - method, expected, got);
}

int bsl_raise(lua_State *L, const char *input, size_t length)
{
    const bs_error *error = &bsl_host_of(L)->cx->error;
    bsl_fault fault = { .code = error->code, .line = error->line };

    snprintf(fault.message, sizeof fault.message, "%s", error->message);
    bsl_where(L, fault.where, sizeof fault.where);
    if (error->offset >= 0 && input) {
        fault.position = error->offset + 1;
        bs_error_caret(error, input, length, fault.caret, sizeof fault.caret);
    }
    bsl_raise_fault(L, &fault);
}

int bsl_raise_from(lua_State *L, bs_mark mark, const char *input, size_t length)
{
    bs_arena_rewind(&bsl_host_of(L)->results, mark);
    bsl_raise(L, input, length);
}

int bsl_error(lua_State *L, bs_status code, const char *format, ...)
{
    bsl_fault fault = { .code = code };
    va_list arguments;

    va_start(arguments, format);
    vsnprintf(fault.message, sizeof fault.message, format, arguments);
    va_end(arguments);
    bsl_where(L, fault.where, sizeof fault.where);
    bsl_raise_fault(L, &fault);
}

static void copy_field(lua_State *L, int object, const char *field, char *out, size_t size)
{
    lua_pushstring(L, field);
    lua_rawget(L, object);
    if (lua_type(L, -1) == LUA_TSTRING)
        snprintf(out, size, "%s", lua_tostring(L, -1));
    lua_pop(L, 1);
}

static long number_field(lua_State *L, int object, const char *field)
{
    long value = 0;

    lua_pushstring(L, field);
    lua_rawget(L, object);
    if (lua_isinteger(L, -1))
        value = (long)lua_tointeger(L, -1);
    lua_pop(L, 1);
    return value;
}

static bs_status status_of_text(const char *text)
{
#define X(code, words)                                                                             \
    if (strcmp(text, words) == 0)                                                                  \
        return code;
    BS_STATUS_LIST(X)
#undef X
    return BS_ESCRIPT;
}

/* Is the value at `i` an error object? */
static bool is_fault(lua_State *L, int i)
{
    bool same;

    if (!lua_istable(L, i) || !lua_getmetatable(L, i))
        return false;
    luaL_getmetatable(L, ERROR_TYPE);
    same = lua_rawequal(L, -1, -2);
    lua_pop(L, 2);
    return same;
}

/* take_fault(value, fault): the protected part. Only the user's own state runs a __tostring. */
static int read_fault(lua_State *L)
{
    bsl_fault *fault = lua_touserdata(L, 2);
    char code[64] = "";
    const char *text;
    size_t length;

    if (is_fault(L, 1)) {
        copy_field(L, 1, "code", code, sizeof code);
        copy_field(L, 1, "message", fault->message, sizeof fault->message);
        copy_field(L, 1, "where", fault->where, sizeof fault->where);
        copy_field(L, 1, "caret", fault->caret, sizeof fault->caret);
        fault->position = number_field(L, 1, "position");
        fault->line = number_field(L, 1, "line");
        fault->code = status_of_text(code);
        return 0;
    }
    if (lua_type(L, 1) == LUA_TSTRING) {
        text = lua_tolstring(L, 1, &length);
    } else if (bsl_host_of(L)->kind == BSL_MAIN && luaL_getmetafield(L, 1, "__tostring")) {
        text = luaL_tolstring(L, 1, &length);
    } else {
        snprintf(fault->message, sizeof fault->message, "the error is no text but %s%s",
                 lua_isnoneornil(L, 1) ? "" : "a ", luaL_typename(L, 1));
        return 0;
    }
    bsl_printable(text, length, fault->message, sizeof fault->message);
    return 0;
}

void bsl_take_fault(lua_State *L, bsl_fault *fault)
{
    *fault = (bsl_fault){ .code = BS_ESCRIPT };
    lua_checkstack(L, 5);
    lua_pushcfunction(L, read_fault);
    lua_insert(L, -2);
    lua_pushlightuserdata(L, fault);
    if (lua_pcall(L, 2, 0, 0) != LUA_OK) {
        lua_pop(L, 1);
        *fault = (bsl_fault){ .code = BS_ENOMEM, .message = "out of memory" };
    }
}

bs_status bsl_fail_fault(bs_ctx *cx, const bsl_fault *fault)
{
    return bs_fail(cx, fault->code, "%s%s%s", fault->where, fault->where[0] ? ": " : "",
                   fault->message);
}

/* tostring(error): "file:line: message", then the line with a caret */
static int fault_tostring(lua_State *L)
{
    bsl_fault fault = { .code = BS_OK };

    luaL_checktype(L, 1, LUA_TTABLE);
    copy_field(L, 1, "message", fault.message, sizeof fault.message);
    copy_field(L, 1, "where", fault.where, sizeof fault.where);
    copy_field(L, 1, "caret", fault.caret, sizeof fault.caret);
    lua_pushfstring(L, "%s%s%s%s%s", fault.where, fault.where[0] ? ": " : "", fault.message,
                    fault.caret[0] ? "\n" : "", fault.caret);
    return 1;
}

/* core.fail(code, message [, where]) raises an error object; code is a status in words */
static int core_fail(lua_State *L)
{
    bsl_fault fault = { .code = status_of_text(luaL_checkstring(L, 1)) };
    size_t length;
    const char *text = luaL_checklstring(L, 2, &length);

    bsl_printable(text, length, fault.message, sizeof fault.message);
    if (lua_isstring(L, 3))
        snprintf(fault.where, sizeof fault.where, "%s", lua_tostring(L, 3));
    else
        bsl_where(L, fault.where, sizeof fault.where);
    return bsl_raise_fault(L, &fault);
}

/* place = core.where(): "file:line" of the nearest code of the user's or a pack's */
static int core_where(lua_State *L)
{
    char where[BS_MESSAGE_MAX];

    bsl_where(L, where, sizeof where);
    lua_pushstring(L, where);
    return 1;
}

void bsl_open_fault(lua_State *L)
{
    static const luaL_Reg meta[] = { { "__tostring", fault_tostring }, { NULL, NULL } };
    static const luaL_Reg functions[] = { { "fail", core_fail }, { "where", core_where },
                                          { NULL, NULL } };

    luaL_newmetatable(L, ERROR_TYPE);
    luaL_setfuncs(L, meta, 0);
    lua_pushliteral(L, "error");
    lua_setfield(L, -2, "__metatable");
    lua_pop(L, 1);
    luaL_setfuncs(L, functions, 0);
}
