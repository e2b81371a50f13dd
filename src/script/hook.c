/*
 * Functions of rules: the library asks whether a rule may be used at a place, and how well a
 * product is liked; the answer is a Lua function of the state that defined the rule.
 *
 * A function is known by a number: the pack in the upper half, its place in the pack below.
 */
#include "script/host.h"

#include <math.h>
#include <stdio.h>

#define HOOK_BUDGET 2000000
#define HOOK_DEPTH 8

typedef struct hook_call {
    int hook;
    bool is_when;
    const bs_mol *product;
    const bs_site *site;
    bool allowed;
    double score;
} hook_call;

/* Pushes { molecule =, atom = { [map] = ..., [role] = ... } }; the molecule is at `molecule`. */
static void push_site(lua_State *L, int molecule, const bs_mol *mol, const bs_site *site)
{
    bsl_host *host = bsl_host_of(L);
    bs_mark mark = bs_arena_mark(&host->results);
    const int *classes = bsl_symmetry(L, mol, mark);

    lua_createtable(L, 0, 2);
    lua_pushvalue(L, molecule);
    lua_setfield(L, -2, "molecule");
    lua_createtable(L, site->count, 0);
    for (int i = 0; i < site->count; i++) {
        if (site->atoms[i] == UINT32_MAX)
            continue;
        bsl_push_atom(L, mol, classes, (int)site->atoms[i]);
        lua_pushinteger(L, (lua_Integer)site->atoms[i] + 1);
        lua_setfield(L, -2, "index");
        lua_rawseti(L, -2, site->maps[i]);
    }
    for (int i = 0; i < site->roles.count; i++) {
        lua_rawgeti(L, -1, site->role_maps[i]);
        lua_setfield(L, -2, site->roles.items[i]);
    }
    lua_setfield(L, -2, "atom");
    bs_arena_rewind(&host->results, mark);
}

/* The protected part of a call: argument is the hook_call. */
static int run_hook(lua_State *L)
{
    hook_call *call = lua_touserdata(L, 1);

    bsl_pushmol(L, call->product, NULL);
    lua_getfield(L, LUA_REGISTRYINDEX, "backsaw.hooks");
    if (lua_rawgeti(L, -1, call->hook) != LUA_TFUNCTION)
        return luaL_error(L, "a function of a rule is missing");
    if (call->is_when) {
        push_site(L, 2, call->product, call->site);
        lua_call(L, 1, 1);
        if (!lua_isboolean(L, -1) && !lua_isnil(L, -1))
            return luaL_error(L, "'when' must give true or false, not a %s", luaL_typename(L, -1));
        call->allowed = lua_toboolean(L, -1);
        return 0;
    }
    lua_pushvalue(L, 2);
    push_site(L, 2, call->product, call->site);
    lua_call(L, 2, 1);
    if (lua_type(L, -1) != LUA_TNUMBER || isnan(lua_tonumber(L, -1)))
        return luaL_error(L, "'prefer' must give a number, not %s",
                          lua_type(L, -1) == LUA_TNUMBER ? "NaN" : luaL_typename(L, -1));
    call->score = lua_tonumber(L, -1);
    return 0;
}

static bs_status call_hook(bsl_host *host, bs_ctx *cx, hook_call *call)
{
    bs_ctx *kept = host->cx;
    bsl_fault fault;
    int status;

    if (host->depth >= HOOK_DEPTH)
        return bs_fail(cx, BS_ELIMIT, "functions of rules call each other too deeply");
    host->depth++;
    host->breach = NULL;
    host->cx = cx;
    lua_checkstack(host->calls, 4);
    lua_pushcfunction(host->calls, run_hook);
    lua_pushlightuserdata(host->calls, call);
    status = bsl_call(host, host->calls, 1, 0, HOOK_BUDGET);
    host->depth--;
    host->cx = kept;
    if (status == LUA_OK)
        return BS_OK;
    bsl_take_fault(host->calls, &fault);
    if (status == LUA_ERRMEM && !host->breach)
        return bs_fail_memory(cx);
    if (status == LUA_ERRMEM)
        snprintf(fault.message, sizeof fault.message, "%s", host->breach);
    /* To the library, a budget that ran out inside a rule is a failure, not a limit of its own. */
    if (fault.code != BS_ESTOPPED && fault.code != BS_ENOMEM)
        fault.code = BS_ESCRIPT;
    return bsl_fail_fault(cx, &fault);
}

static bsl_host *session_host(bs_session *session, int hook)
{
    return hook >> 16 == 0 ? session->main : session->packs;
}

static bs_status session_when(void *payload, bs_ctx *cx, int hook, const bs_mol *product,
                              const bs_site *site, bool *allowed)
{
    hook_call call = {.hook = hook, .is_when = true, .product = product, .site = site};
    bs_status st = call_hook(session_host(payload, hook), cx, &call);

    *allowed = call.allowed;
    return st;
}

static bs_status session_prefer(void *payload, bs_ctx *cx, int hook, const bs_mol *product,
                                const bs_site *site, double *score)
{
    hook_call call = {.hook = hook, .product = product, .site = site};
    bs_status st = call_hook(session_host(payload, hook), cx, &call);

    *score = call.score;
    return st;
}

bs_rule_hooks bsl_session_hooks(bs_session *session)
{
    return (bs_rule_hooks){.payload = session, .when = session_when, .prefer = session_prefer};
}

/* ---- Lanes ----------------------------------------------------------------------------- */

static void drop_state(bsl_lane *lane, bs_ctx *cx)
{
    bs_session *session = lane->session;

    if (lane->host)
        lane->host->cx = cx;
    bsl_host_free(lane->host);
    bs_gate_free(session->cx.gate, lane->replayed, (size_t)session->pack_count);
    *lane = (bsl_lane){.session = session};
}

/* Makes the state of a lane and reads the pack of a hook in it, when either is first needed. */
static bs_status ready_lane(bsl_lane *lane, bs_ctx *cx, int hook)
{
    bs_session *session = lane->session;
    size_t packs = (size_t)session->pack_count;
    bsl_fault fault;

    if (!lane->host) {
        lane->replayed = bs_gate_alloc(cx->gate, packs);
        if (!lane->replayed)
            return bs_fail_memory(cx);
        if (bsl_host_new(session, cx, BSL_LANE, &lane->host) != BS_OK)
            return bs_fail_memory(cx); /* there are such states, so nothing else can be wrong */
    }
    if (lane->replayed[hook >> 16])
        return BS_OK;
    lane->replayed[hook >> 16] = true;
    if (bsl_replay(lane->host, cx, hook >> 16, &fault) == BS_OK)
        return BS_OK;
    if (fault.code != BS_ESTOPPED && fault.code != BS_ENOMEM)
        fault.code = BS_ESCRIPT;
    return bsl_fail_fault(cx, &fault);
}

/* Calls a function in a lane. A state in which one failed is dropped; the next call makes another,
   so that nothing of the failure is left. */
static bs_status call_lane(bsl_lane *lane, bs_ctx *cx, hook_call *call)
{
    bs_status st = ready_lane(lane, cx, call->hook);

    if (st == BS_OK)
        st = call_hook(lane->host, cx, call);
    if (st != BS_OK)
        drop_state(lane, cx);
    return st;
}

static bs_status lane_when(void *payload, bs_ctx *cx, int hook, const bs_mol *product,
                           const bs_site *site, bool *allowed)
{
    hook_call call = {.hook = hook, .is_when = true, .product = product, .site = site};
    bs_status st = call_lane(payload, cx, &call);

    *allowed = call.allowed;
    return st;
}

static bs_status lane_prefer(void *payload, bs_ctx *cx, int hook, const bs_mol *product,
                             const bs_site *site, double *score)
{
    hook_call call = {.hook = hook, .product = product, .site = site};
    bs_status st = call_lane(payload, cx, &call);

    *score = call.score;
    return st;
}

bs_rule_hooks bsl_lane_hooks(bsl_lane *lane)
{
    return (bs_rule_hooks){.payload = lane, .when = lane_when, .prefer = lane_prefer};
}

void bsl_lane_free(bsl_lane *lane)
{
    drop_state(lane, &lane->session->cx);
}
