/*
 * Planning from Lua. The embedded module `plan` checks what the user wrote and hands over a table
 * of plain fields; here it becomes the options of the search, and the user's functions become its
 * callbacks. A callback runs protected; what it raised is kept and raised again after the search.
 */
#include "script/host.h"

#include <math.h>
#include <stdio.h>
#include <string.h>
#include <unistd.h>

#define SHELF_TYPE "backsaw.shelf"
#define SEARCH_TYPE "backsaw.search"
#define LANES 8

typedef struct shelf_box {
    bs_shelf *shelf; /* NULL once freed */
} shelf_box;

/* What callbacks need: the running state, where the options lie on its stack, the first failure. */
typedef struct planner {
    lua_State *L;
    bsl_host *host;
    int options;
    bool failed;
    bsl_fault fault;
    bs_trace *trace;
} planner;

typedef struct question {
    const char *function;
    const bs_route *route;
    bool as_step;
    const bs_mol *mol;
    const char *smiles;
    const double *price; /* a second argument, or NULL */
    bool yes;
    double number;
    bool wants_number;
} question;

static int shelf_gc(lua_State *L)
{
    shelf_box *box = luaL_checkudata(L, 1, SHELF_TYPE);

    bs_shelf_free(box->shelf);
    box->shelf = NULL;
    return 0;
}

/* ---- Callbacks ------------------------------------------------------------------------- */

/* The protected part: arguments are the function and the question. */
static int run_question(lua_State *L)
{
    question *ask = lua_touserdata(L, 2);

    lua_settop(L, 2);
    lua_pushvalue(L, 1);
    if (ask->mol)
        bsl_pushmol(L, ask->mol, ask->smiles);
    else if (ask->as_step)
        bsl_push_route_step(L, ask->route, 0);
    else
        bsl_push_route(L, ask->route);
    if (ask->price)
        lua_pushnumber(L, *ask->price);
    lua_call(L, ask->price ? 2 : 1, 1);
    ask->yes = lua_toboolean(L, -1);
    if (!ask->wants_number)
        return 0;
    if (lua_type(L, -1) != LUA_TNUMBER || isnan(lua_tonumber(L, -1)))
        return bsl_error(L, BS_EVALUE, "plan: '%s' must give a number, not %s", ask->function,
                         lua_type(L, -1) == LUA_TNUMBER ? "NaN" : luaL_typename(L, -1));
    ask->number = lua_tonumber(L, -1);
    return 0;
}

static bs_status put_question(planner *p, bs_ctx *cx, question *ask)
{
    lua_State *L = p->L;

    if (!lua_checkstack(L, 8))
        return bs_fail_memory(cx);
    lua_pushcfunction(L, run_question);
    lua_pushstring(L, ask->function);
    lua_rawget(L, p->options);
    lua_pushlightuserdata(L, ask);
    if (bsl_call(p->host, L, 2, 0, 0) == LUA_OK)
        return BS_OK;
    bsl_take_fault(L, &p->fault);
    p->failed = p->fault.code != BS_ESTOPPED;
    return bsl_fail_fault(cx, &p->fault);
}

static bs_status ask_allow(void *payload, bs_ctx *cx, const bs_route *step, bool *allowed)
{
    question ask = { .function = "allow", .route = step, .as_step = true };
    bs_status st = put_question(payload, cx, &ask);

    *allowed = ask.yes;
    return st;
}

static bs_status ask_cost(void *payload, bs_ctx *cx, const bs_route *step, double *cost)
{
    question ask = { .function = "cost", .route = step, .as_step = true, .wants_number = true };
    bs_status st = put_question(payload, cx, &ask);

    *cost = ask.number;
    return st;
}

static bs_status ask_guess(void *payload, bs_ctx *cx, const bs_mol *mol, const char *smiles,
                           double *cost)
{
    question ask = { .function = "guess", .mol = mol, .smiles = smiles, .wants_number = true };
    bs_status st = put_question(payload, cx, &ask);

    *cost = ask.number;
    return st;
}

static bs_status ask_leaf(void *payload, bs_ctx *cx, const bs_mol *mol, const char *smiles,
                          double price, double *cost)
{
    question ask = {
        .function = "leaf", .mol = mol, .smiles = smiles, .price = &price, .wants_number = true
    };
    bs_status st = put_question(payload, cx, &ask);

    *cost = ask.number;
    return st;
}

static bs_status ask_keep(void *payload, bs_ctx *cx, const bs_route *route, bool *kept)
{
    question ask = { .function = "keep", .route = route };
    bs_status st = put_question(payload, cx, &ask);

    *kept = ask.yes;
    return st;
}

static bs_status ask_rank(void *payload, bs_ctx *cx, const bs_route *route, double *rank)
{
    question ask = { .function = "rank", .route = route, .wants_number = true };
    bs_status st = put_question(payload, cx, &ask);

    *rank = ask.number;
    return st;
}

static bs_status pass_event(void *payload, bs_ctx *cx, const bs_plan_event *event)
{
    return bs_trace_event(cx, ((planner *)payload)->trace, event);
}

static void show_progress(void *payload, const bs_plan_progress *now)
{
    const bs_session *session = ((planner *)payload)->host->session;

    session->opts.progress(session->opts.payload, now);
}

/* ---- Options --------------------------------------------------------------------------- */

static double number_option(lua_State *L, int i, const char *field)
{
    double value;

    lua_getfield(L, i, field);
    value = lua_tonumber(L, -1);
    lua_pop(L, 1);
    return value;
}

static bool has_option(lua_State *L, int i, const char *field)
{
    bool there = lua_getfield(L, i, field) != LUA_TNIL;

    lua_pop(L, 1);
    return there;
}

/* Puts the list { { molecule, price }, ... } at the top of the stack on the shelf. */
static void add_list(lua_State *L, bs_shelf *shelf)
{
    bs_ctx *cx = bsl_host_of(L)->cx;
    int count = (int)lua_rawlen(L, -1), list;

    if (bs_shelf_add_list(cx, shelf, &list) != BS_OK)
        bsl_raise(L, NULL, 0);
    for (int i = 0; i < count; i++) {
        lua_rawgeti(L, -1, i + 1);
        lua_rawgeti(L, -1, 1);
        lua_rawgeti(L, -2, 2);
        if (bs_shelf_put(cx, shelf, list, bsl_checkmol(L, -2), lua_tonumber(L, -1)) != BS_OK)
            bsl_raise(L, NULL, 0);
        lua_pop(L, 3);
    }
}

/* Makes the shelf of the options at `i` and pushes its box, whose uservalue keeps the options. */
static bs_shelf *push_shelf(lua_State *L, int i)
{
    bs_ctx *cx = bsl_host_of(L)->cx;
    shelf_box *box = lua_newuserdatauv(L, sizeof *box, 0);
    int count;

    box->shelf = NULL;
    luaL_setmetatable(L, SHELF_TYPE);
    if (bs_shelf_new(cx, &box->shelf) != BS_OK)
        bsl_raise(L, NULL, 0);
    lua_getfield(L, i, "sources");
    count = (int)lua_rawlen(L, -1);
    for (int k = 0; k < count; k++) {
        bs_catalogue *catalogue;

        lua_rawgeti(L, -1, k + 1);
        catalogue = bsl_testcatalogue(L, -1);
        if (!catalogue)
            add_list(L, box->shelf);
        else if (bs_shelf_add_catalogue(cx, box->shelf, catalogue) != BS_OK)
            bsl_raise(L, NULL, 0);
        lua_pop(L, 1);
    }
    lua_getfield(L, i, "at_hand");
    count = (int)lua_rawlen(L, -1);
    for (int k = 0; k < count; k++) {
        lua_rawgeti(L, -1, k + 1);
        if (bs_shelf_at_hand(cx, box->shelf, bsl_checkmol(L, -1)) != BS_OK)
            bsl_raise(L, NULL, 0);
        lua_pop(L, 1);
    }
    lua_pop(L, 2);
    return box->shelf;
}

static const char *text_option(lua_State *L, const char *field)
{
    const char *text;

    lua_getfield(L, -1, field);
    text = lua_tostring(L, -1);
    lua_pop(L, 1);
    return text;
}

static bs_words words_option(lua_State *L, const char *field)
{
    bsl_host *host = bsl_host_of(L);
    bs_words words = { NULL, 0 };
    const char **items;

    if (lua_getfield(L, -1, field) == LUA_TTABLE) {
        words.count = (int)lua_rawlen(L, -1);
        if (bs_new(host->cx, &host->results, words.count + 1, &items) != BS_OK)
            bsl_raise(L, NULL, 0);
        for (int i = 0; i < words.count; i++) {
            lua_rawgeti(L, -1, i + 1);
            items[i] = lua_tostring(L, -1);
            lua_pop(L, 1);
        }
        words.items = items;
    }
    lua_pop(L, 1);
    return words;
}

/* One known step from the table at the top of the stack, which keeps its strings alive. */
static void read_known(lua_State *L, bs_known_step *known)
{
    bsl_host *host = bsl_host_of(L);
    const char **from;
    double *equivalents;

    known->product = text_option(L, "product");
    known->name = text_option(L, "name");
    known->conditions = text_option(L, "conditions");
    known->recipe = text_option(L, "recipe");
    known->source = text_option(L, "source");
    known->reagents = words_option(L, "reagents");
    known->cautions = words_option(L, "cautions");
    known->has_cost = has_option(L, -1, "cost");
    known->cost = number_option(L, -1, "cost");
    known->yield = number_option(L, -1, "yield");
    lua_getfield(L, -1, "from");
    lua_getfield(L, -2, "equiv");
    known->from_count = (int)lua_rawlen(L, -2);
    if (bs_new(host->cx, &host->results, known->from_count + 1, &from) != BS_OK ||
        bs_new(host->cx, &host->results, known->from_count + 1, &equivalents) != BS_OK)
        bsl_raise(L, NULL, 0);
    for (int i = 0; i < known->from_count; i++) {
        lua_rawgeti(L, -2, i + 1);
        from[i] = lua_tostring(L, -1);
        lua_pop(L, 1);
        if (!lua_istable(L, -1))
            continue;
        lua_rawgeti(L, -1, i + 1);
        equivalents[i] = lua_tonumber(L, -1);
        lua_pop(L, 1);
    }
    known->from = from;
    known->equivalents = lua_istable(L, -1) ? equivalents : NULL;
    lua_pop(L, 2);
}

static void read_known_steps(lua_State *L, int i, bs_plan_opts *opts)
{
    bsl_host *host = bsl_host_of(L);
    bs_known_step *known;

    lua_getfield(L, i, "known");
    opts->known_count = (int)lua_rawlen(L, -1);
    if (bs_new(host->cx, &host->results, opts->known_count + 1, &known) != BS_OK)
        bsl_raise(L, NULL, 0);
    for (int k = 0; k < opts->known_count; k++) {
        lua_rawgeti(L, -1, k + 1);
        read_known(L, &known[k]);
        lua_pop(L, 1);
    }
    opts->known = known;
    lua_pop(L, 1);
}

static void read_transforms(lua_State *L, int i, bs_plan_opts *opts)
{
    bsl_host *host = bsl_host_of(L);
    int *indices;

    if (lua_getfield(L, i, "transforms") == LUA_TTABLE) {
        opts->transform_count = (int)lua_rawlen(L, -1);
        if (bs_new(host->cx, &host->results, opts->transform_count + 1, &indices) != BS_OK)
            bsl_raise(L, NULL, 0);
        for (int k = 0; k < opts->transform_count; k++) {
            lua_rawgeti(L, -1, k + 1);
            indices[k] = (int)lua_tointeger(L, -1);
            lua_pop(L, 1);
        }
        opts->transforms = indices;
    }
    lua_pop(L, 1);
}

static void read_limits(lua_State *L, int i, bs_plan_opts *opts)
{
    opts->limits.depth = (int)number_option(L, i, "depth");
    opts->limits.steps = (int)number_option(L, i, "steps");
    opts->limits.molecules = (long)number_option(L, i, "molecules");
    opts->limits.seconds = number_option(L, i, "seconds");
    opts->limits.memory = (size_t)number_option(L, i, "memory");
    opts->best = (int)number_option(L, i, "best");
    opts->has_step_cost = has_option(L, i, "step_cost");
    opts->step_cost = number_option(L, i, "step_cost");
    opts->clashes = (bs_clash_policy)number_option(L, i, "clash_policy");
    opts->has_clash_cost = has_option(L, i, "clash_cost");
    opts->clash_cost = number_option(L, i, "clash_cost");
    opts->mode = has_option(L, i, "additive") ? BS_COST_ADDITIVE : BS_COST_PER_MOLE;
    opts->strategy = has_option(L, i, "proof")     ? BS_STRATEGY_PROOF
                     : has_option(L, i, "breadth") ? BS_STRATEGY_BREADTH
                                                   : BS_STRATEGY_CHEAPEST;
    opts->has_overlap = has_option(L, i, "diverse");
    opts->overlap = number_option(L, i, "diverse");
}

static void read_callbacks(lua_State *L, int i, bs_plan_opts *opts, planner *p)
{
    const bs_session *session = p->host->session;

    opts->payload = p;
    opts->allow = has_option(L, i, "allow") ? ask_allow : NULL;
    opts->cost = has_option(L, i, "cost") ? ask_cost : NULL;
    opts->guess = has_option(L, i, "guess") ? ask_guess : NULL;
    opts->leaf = has_option(L, i, "leaf") ? ask_leaf : NULL;
    opts->keep = has_option(L, i, "keep") ? ask_keep : NULL;
    opts->rank = has_option(L, i, "rank") ? ask_rank : NULL;
    if (session->opts.progress && !has_option(L, i, "quiet"))
        opts->progress = show_progress;
    if (p->trace)
        opts->trace = pass_event;
}

/* Lends the catalogues of the options to the search (or takes them back), so that a callback
   cannot close them. Raises before anything is lent if one is closed. */
static void lend_catalogues(lua_State *L, int i, int change)
{
    lua_getfield(L, i, "sources");
    for (int k = (int)lua_rawlen(L, -1); change > 0 && k > 0; k--) {
        lua_rawgeti(L, -1, k);
        bsl_testcatalogue(L, -1);
        lua_pop(L, 1);
    }
    for (int k = (int)lua_rawlen(L, -1); k > 0; k--) {
        lua_rawgeti(L, -1, k);
        bsl_lend_catalogue(L, -1, change);
        lua_pop(L, 1);
    }
    lua_pop(L, 1);
}

/* Threads, and lanes for the functions of packs; the user's own functions need the main state, so
   with such one thread works. */
static void set_lanes(lua_State *L, bs_plan_opts *opts, bsl_lane *lanes, bs_rule_hooks *hooks)
{
    bs_session *session = bsl_host_of(L)->session;
    long processors = sysconf(_SC_NPROCESSORS_ONLN);
    int threads = (int)number_option(L, 1, "threads");

    for (int i = 0; i < LANES; i++) {
        lanes[i] = (bsl_lane){ .session = session };
        hooks[i] = bsl_lane_hooks(&lanes[i]);
    }
    if (bsl_has_own_hooks(session))
        return;
    opts->lane_hooks = hooks;
    opts->lane_count = LANES;
    if (threads == 0)
        threads = processors > 1 ? (int)processors : 1;
    opts->threads = threads < LANES ? threads : LANES;
}

static void open_trace(lua_State *L, int i, planner *p)
{
    lua_getfield(L, i, "trace");
    if (lua_isstring(L, -1) && bs_trace_open(p->host->cx, lua_tostring(L, -1), &p->trace) != BS_OK)
        bsl_raise(L, NULL, 0);
    lua_pop(L, 1);
}

/* Says that the search was stopped by Ctrl-C, and what is there. */
static void say_stopped(const bs_session *session, const bs_routes *routes)
{
    char line[120];

    snprintf(line, sizeof line, "the search was stopped; %d route%s found so far", routes->count,
             routes->count == 1 ? " was" : "s were");
    if (session->opts.say)
        session->opts.say(session->opts.payload, line);
}

/* Says the warnings that were not there yet. */
static void say_warnings(const bs_session *session, const bs_routes *routes, int *said)
{
    for (; *said < routes->warning_count; ++*said) {
        char line[BS_MESSAGE_MAX + 200];

        snprintf(line, sizeof line, "warning: %s", routes->warnings[*said]);
        if (session->opts.say)
            session->opts.say(session->opts.payload, line);
    }
}

/* ---- Searches that are kept --------------------------------------------------------------- */

/* Large graphs that nobody holds any more are freed before a new one grows. */
#define MUCH_MEMORY ((size_t)64 << 20)

typedef struct search_box {
    bs_search *search; /* NULL once freed */
    bool running;
    int said; /* warnings */
} search_box;

static int search_gc(lua_State *L)
{
    search_box *box = luaL_checkudata(L, 1, SEARCH_TYPE);

    bs_search_free(box->search);
    box->search = NULL;
    return 0;
}

/* The box of the search behind the list at `i`, pushed. Its user values: options, shelf. */
static bs_search *push_search(lua_State *L, int i)
{
    search_box *box = NULL;

    if (lua_getiuservalue(L, i, 2) != LUA_TUSERDATA ||
        !(box = luaL_testudata(L, -1, SEARCH_TYPE)) || !box->search)
        bsl_error(L, BS_EVALUE, "this list of routes has no search behind it");
    if (box->running)
        bsl_error(L, BS_EVALUE, "the search is running");
    return box->search;
}

/*
 * Runs the search in the box at `at` by the options at 1, or ranks it anew, and pushes the list,
 * which keeps the box. What the options point to on this stack is gone afterwards.
 */
static int run_search(lua_State *L, int at, bs_plan_opts *opts, const bs_rerank *what)
{
    bsl_host *host = bsl_host_of(L);
    bs_session *session = host->session;
    search_box *box = lua_touserdata(L, at);
    bs_rule_hooks hooks = bsl_session_hooks(session), lane_hooks[LANES];
    planner plan = { .L = L, .host = host, .options = 1 };
    bsl_lane lanes[LANES];
    bs_routes *routes = NULL;
    bs_status st, closed;

    opts->hooks = &hooks;
    opts->lane_hooks = NULL;
    opts->lane_count = opts->threads = 0;
    opts->progress = NULL;
    opts->trace = NULL;
    open_trace(L, 1, &plan);
    read_limits(L, 1, opts);
    read_callbacks(L, 1, opts, &plan);
    set_lanes(L, opts, lanes, lane_hooks);
    lend_catalogues(L, 1, 1);
    box->running = true;
    st = what ? bs_search_rerank(box->search, opts, what, &routes)
              : bs_search_run(box->search, &routes);
    box->running = false;
    lend_catalogues(L, 1, -1);
    for (int i = 0; i < LANES; i++)
        bsl_lane_free(&lanes[i]);
    closed = bs_trace_close(host->cx, plan.trace);
    if (st == BS_OK && closed != BS_OK) {
        bs_routes_free(host->cx, routes);
        st = closed;
    }
    if (opts->progress)
        session->opts.progress(session->opts.payload, NULL);
    if (atomic_load(host->cx->stop)) {
        /* The first Ctrl-C ends the search, whose routes are kept; the script goes on. */
        atomic_store(host->cx->stop, false);
        bsl_calm(host);
        if (st == BS_OK)
            say_stopped(session, routes);
    }
    if (st != BS_OK)
        return plan.failed ? bsl_raise_fault(L, &plan.fault) : bsl_raise(L, NULL, 0);
    if (!has_option(L, 1, "quiet"))
        say_warnings(session, routes, &box->said);
    st = bsl_name_packs(L, routes);
    bsl_push_routes(L, routes);
    lua_pushvalue(L, at);
    lua_setiuservalue(L, -2, 2);
    return st == BS_OK ? 1 : bsl_raise(L, NULL, 0);
}

/* routes = core.plan(options) */
static int core_plan(lua_State *L)
{
    bsl_host *host = bsl_host_of(L);
    bs_mark mark = bs_arena_mark(&host->results);
    bs_plan_opts opts = { .rules = host->session->rules };
    search_box *box;
    bs_status st;

    luaL_checktype(L, 1, LUA_TTABLE);
    luaL_checkstack(L, 20, "plan");
    lua_settop(L, 1);
    if (atomic_load(&host->cx->gate->used) > MUCH_MEMORY)
        lua_gc(L, LUA_GCCOLLECT);
    box = lua_newuserdatauv(L, sizeof *box, 2);
    *box = (search_box){ .search = NULL };
    luaL_setmetatable(L, SEARCH_TYPE);
    lua_pushvalue(L, 1);
    lua_setiuservalue(L, 2, 1);
    opts.shelf = push_shelf(L, 1);
    lua_setiuservalue(L, 2, 2);
    lua_getfield(L, 1, "target");
    read_known_steps(L, 1, &opts);
    read_transforms(L, 1, &opts);
    opts.constraints = bsl_read_constraints(L, 1);
    read_limits(L, 1, &opts);
    st = bs_search_new(host->cx, bsl_checkmol(L, 3), &opts, &box->search);
    bs_arena_rewind(&host->results, mark);
    if (st != BS_OK)
        return bsl_raise(L, NULL, 0);
    lua_settop(L, 2);
    return run_search(L, 2, bs_search_options(box->search), NULL);
}

/* options = core.search_options(routes) */
static int core_search_options(lua_State *L)
{
    push_search(L, 1);
    lua_getiuservalue(L, -1, 1);
    return 1;
}

/* routes = core.extend(options, routes): the options are the search's own from now on */
static int core_extend(lua_State *L)
{
    bs_search *search;

    luaL_checktype(L, 1, LUA_TTABLE);
    luaL_checkstack(L, 20, "plan");
    lua_settop(L, 2);
    search = push_search(L, 2);
    lua_pushvalue(L, 1);
    lua_setiuservalue(L, 3, 1);
    return run_search(L, 3, bs_search_options(search), NULL);
}

/* routes = core.rerank(options, routes, { prices =, costs =, steps =, without = { molecules } }) */
static int core_rerank(lua_State *L)
{
    bsl_host *host = bsl_host_of(L);
    bs_mark mark = bs_arena_mark(&host->results);
    bs_plan_opts opts;
    bs_rerank what = { .prices = false };
    const bs_mol **without;
    int results;

    luaL_checktype(L, 1, LUA_TTABLE);
    luaL_checkstack(L, 20, "plan");
    lua_settop(L, 3);
    opts = *bs_search_options(push_search(L, 2));
    what.prices = has_option(L, 3, "prices");
    what.costs = has_option(L, 3, "costs");
    what.steps = has_option(L, 3, "steps");
    if (what.prices)
        opts.shelf = push_shelf(L, 1);
    lua_getfield(L, 3, "without");
    what.without_count = (int)lua_rawlen(L, -1);
    if (bs_new(host->cx, &host->results, what.without_count + 1, &without) != BS_OK)
        return bsl_raise_from(L, mark, NULL, 0);
    for (int i = 0; i < what.without_count; i++) {
        lua_rawgeti(L, -1, i + 1);
        without[i] = bsl_checkmol(L, -1);
        lua_pop(L, 1);
    }
    what.without = without;
    results = run_search(L, 4, &opts, &what);
    bs_arena_rewind(&host->results, mark);
    return results;
}

void bsl_open_plan(lua_State *L)
{
    static const luaL_Reg meta[] = { { "__gc", shelf_gc }, { NULL, NULL } };
    static const luaL_Reg search_meta[] = { { "__gc", search_gc }, { NULL, NULL } };
    static const luaL_Reg functions[] = {
        { "plan", core_plan },
        { "search_options", core_search_options },
        { "extend", core_extend },
        { "rerank", core_rerank },
        { NULL, NULL },
    };

    bsl_new_type(L, SHELF_TYPE, NULL, meta);
    bsl_new_type(L, SEARCH_TYPE, NULL, search_meta);
    luaL_setfuncs(L, functions, 0);
}
