/*
 * What the files of this layer share: the host of a Lua state, the session, and the ways into and
 * out of Lua.
 *
 * There are three kinds of state. The main state runs the user's code. The pack state reads packs,
 * whose definitions go into the rule book of the session, and runs their functions. A lane is a
 * pack state for one worker of a search: it reads packs again only to have their functions.
 *
 * Errors. Library failures become error objects by bsl_raise(); a table with the fields code,
 * message, position, line, where and caret. They cross from one state to another as a bsl_fault.
 */
#ifndef SCRIPT_HOST_H
#define SCRIPT_HOST_H

#include <lauxlib.h>
#include <lua.h>
#include <lualib.h>

#include "backsaw.h"
#include "backsaw/script.h"

/* An error outside of any Lua state. `where` and `caret` are empty where there is none. */
typedef struct bsl_fault {
    bs_status code;
    long position; /* 1-based, 0 for none */
    long line;
    char message[BS_MESSAGE_MAX];
    char where[BS_MESSAGE_MAX];
    char caret[BS_MESSAGE_MAX];
} bsl_fault;

/* They return an int only so that a C function can say `return bsl_raise(...)`. */
#define BSL_NORETURN __attribute__((noreturn))

typedef enum bsl_kind { BSL_MAIN, BSL_PACKS, BSL_LANE } bsl_kind;

typedef struct bsl_host {
    bs_session *session;
    lua_State *L;
    bsl_kind kind;
    bs_ctx *cx;       /* the session's; in a call of a rule's function, that of the caller */
    bs_arena results; /* what bindings hand over to Lua at once */
    int pack;         /* number of the pack that is being read, 0 in the main state */
    int hook_next;    /* functions of that pack so far */
    size_t memory, memory_limit;
    size_t boxed;     /* bytes outside of Lua that its values hold */
    long budget;      /* instructions left, in a pack state; work of the library counts too */
    size_t grown_from;  /* memory in use when the pack at hand began to be read */
    const char *breach; /* the limit that was reached, in words; or NULL */
    size_t said;      /* bytes that packs have printed */
    lua_State *calls; /* the thread on which functions of rules run */
    int depth;        /* of such calls in one another */
    /* The metatables of the types that are asked for most; they stay in the registry. */
    const void *mol_type, *pattern_type;
} bsl_host;

/* A self-test of a transform: the product, and what it is made from, or that it is refused. */
typedef struct bsl_example {
    struct bsl_example *next;
    int transform;
    bool refuse;
    const char *product;
    const char **from;
    int from_count;
    const char *origin;
} bsl_example;

/* A pack in use. Number 0 stands for the user's own code. */
typedef struct bsl_pack {
    const char *name;    /* as its header says */
    const char *path;    /* the file */
    const char *version; /* or NULL */
    const char *about;   /* or NULL */
    bool done;           /* read to its end */
    bool hooked;         /* has functions, so lanes need it */
    const char *shown;   /* its file, as messages name it */
    const char *text;    /* kept for lanes, if it has functions */
    size_t length;
} bsl_pack;

struct bs_session {
    bs_ctx cx;
    bs_arena home; /* strings and tables that live as long as the session */
    bsl_host *main;
    bsl_host *packs;
    bs_rules *rules;
    bsl_pack *pack_list;
    int pack_count, pack_room;
    bsl_example *examples, **examples_end;
    char *folders; /* places to look for packs, separated by NUL, ended by an empty one */
    char *library; /* folder of the standard library, or NULL */
    bs_session_opts opts;
    bs_text message;
};

/* ---- States (host.c) ------------------------------------------------------------------- */

bs_status bsl_host_new(bs_session *session, bs_ctx *cx, bsl_kind kind, bsl_host **out);
void bsl_host_free(bsl_host *host);

/* The host of a running state. */
bsl_host *bsl_host_of(lua_State *L);

/*
 * Calls function and arguments on the stack of L, like lua_pcall, with the session's bounds in force;
 * what the call left in the results arena is given back. In a pack state `budget` instructions
 * may be used (0: as many as are left). The error value is on the stack after a failure.
 */
int bsl_call(bsl_host *host, lua_State *L, int arguments, int results, long budget);

/*
 * Counts the arena that a value holds outside of Lua, once it is filled, and takes it off the count
 * before it is freed. Counting raises when a pack state holds too much.
 */
void bsl_box(lua_State *L, const bs_arena *arena);
void bsl_unbox(lua_State *L, const bs_arena *arena);

/* Raises when what a pack has defined takes too much memory. */
void bsl_check_growth(lua_State *L);

/* Makes the running main state stop at its next instruction (signal-safe), or takes that back. */
void bsl_interrupt(bsl_host *host);
void bsl_calm(bsl_host *host);

/*
 * Pushes the result of an embedded Lua module ("pack", ...), which is run once a state with the
 * private table `core` as argument.
 */
void bsl_push_module(lua_State *L, const char *name);

/* The text of an embedded Lua file, or NULL. */
const char *bsl_embedded(const char *name, size_t *length);

/* ---- Errors (fault.c) ------------------------------------------------------------------ */

/* Registers the metatable of error objects and the primitives `fail`, `where`. */
void bsl_open_fault(lua_State *L);

/* Raises the error of the host's context; `input` (or NULL) is the text that its offset is in. */
BSL_NORETURN int bsl_raise(lua_State *L, const char *input, size_t length);

/* The same with the mark of the results arena to go back to. */
BSL_NORETURN int bsl_raise_from(lua_State *L, bs_mark mark, const char *input, size_t length);

/* Raises an error object of this code. */
BSL_NORETURN int bsl_error(lua_State *L, bs_status code, const char *format, ...)
    __attribute__((format(printf, 3, 4)));

/* Pushes what a fault holds as an error object. */
void bsl_push_fault(lua_State *L, const bsl_fault *fault);

/* Raises what a fault holds. */
BSL_NORETURN int bsl_raise_fault(lua_State *L, const bsl_fault *fault);

/* Raises an argument error: what was expected at index `i`, and what is there. */
BSL_NORETURN int bsl_type_error(lua_State *L, int i, const char *expected);

/* Turns the error value at the top of the stack into a fault and pops it. Never raises. */
void bsl_take_fault(lua_State *L, bsl_fault *fault);

/* Puts a fault into the error of a context, as one line. */
bs_status bsl_fail_fault(bs_ctx *cx, const bsl_fault *fault);

/* Writes file and line of the nearest Lua code that is not our own; an empty string if none. */
void bsl_where(lua_State *L, char *out, size_t size);

/* Writes a text in a form that is safe to show: control bytes escaped, cut to `size`. */
void bsl_printable(const char *text, size_t length, char *out, size_t size);

/* ---- Values ---------------------------------------------------------------------------- */

/* One opener a type; `core` (the private table) is at the top of the stack and stays there. */
void bsl_open_mol(lua_State *L);
void bsl_open_pattern(lua_State *L);
void bsl_open_rewrite(lua_State *L);
void bsl_open_polarity(lua_State *L); /* after bsl_open_mol() */
void bsl_open_example(lua_State *L);
void bsl_open_why(lua_State *L);
void bsl_open_descriptor(lua_State *L); /* after bsl_open_mol() */
void bsl_open_direct(lua_State *L);         /* the same */
void bsl_open_define(lua_State *L);
void bsl_open_group(lua_State *L); /* after that of molecules, to which it adds methods */
void bsl_open_clash(lua_State *L);
void bsl_open_transform(lua_State *L);
void bsl_open_catalogue(lua_State *L);
void bsl_open_plan(lua_State *L);
void bsl_open_route(lua_State *L);
void bsl_open_explain(lua_State *L);
void bsl_open_report(lua_State *L); /* after that of routes, to which it adds methods */
void bsl_open_pack(lua_State *L);
void bsl_open_writer(lua_State *L);
void bsl_open_file(lua_State *L); /* after that of molecules, to which it adds methods */

/* What the commands that study packs need besides; adds to the private table. */
void bsl_open_study(lua_State *L);

/* Makes the locked metatable of a type ("backsaw." and a word) from methods and metamethods, and
   registers it. */
void bsl_new_type(lua_State *L, const char *type, const luaL_Reg *methods, const luaL_Reg *meta);

/*
 * The block of a userdata whose metatable is `type` (as lua_topointer() shows it), or NULL: like
 * luaL_testudata(), but without a look into the registry.
 */
void *bsl_test_type(lua_State *L, int i, const void *type);

/* Number of a molecule's uservalue with what its file says beside the structure: a table with name,
   fields and doubts, or nil. */
#define BSL_MOL_RECORD 2

/* A copy of the molecule becomes a Lua value; `smiles` is its canonical SMILES or NULL. */
void bsl_pushmol(lua_State *L, const bs_mol *mol, const char *smiles);

/* The molecule at index `i`, or an argument error. */
const bs_mol *bsl_checkmol(lua_State *L, int i);

/* The molecule at index `i`, or NULL. */
const bs_mol *bsl_testmol(lua_State *L, int i);

/* The same, but a string is read as SMILES; the value at `i` becomes the molecule. */
const bs_mol *bsl_tomol(lua_State *L, int i);

/* Pushes a text as a string and frees it, also when that raises; returns 1. */
int bsl_push_text(lua_State *L, bs_text *text);

/* Pushes the canonical SMILES of the molecule value at `i`, which keeps it. */
const char *bsl_push_canonical(lua_State *L, int i);

/* The pattern at index `i`; a string is compiled (once), and the value at `i` becomes it. */
const bs_pattern *bsl_topattern(lua_State *L, int i);

/* Pushes the matches of a pattern as a list of lists of atoms, or their number; returns 1. */
int bsl_push_matches(lua_State *L, const bs_mol *mol, const bs_pattern *pattern, int options);
int bsl_count_matches(lua_State *L, const bs_mol *mol, const bs_pattern *pattern);

/*
 * The molecules (or SMILES) at stack indices `first` to the top, as an array in the results
 * arena; the stack keeps them alive.
 */
const bs_mol **bsl_collect_mols(lua_State *L, int first, int *count);

/* Symmetry classes of a molecule in the results arena; rewinds it to `mark` before it raises. */
const int *bsl_symmetry(lua_State *L, const bs_mol *mol, bs_mark mark);

/*
 * Pushes an atom's table: element, hydrogens, charge, and so on. `atom` is 0-based, `classes` those
 * of bsl_symmetry().
 */
void bsl_push_atom(lua_State *L, const bs_mol *mol, const int *classes, int atom);

/* Pushes the table of the two ends of a bond: atoms, labels, donor, acceptor, umpolung. */
void bsl_push_poles(lua_State *L, const bs_pole *ends);

/* Pushes a step's table for a step of the rule book; the product's value is at `product`. */
void bsl_push_step(lua_State *L, int product, const bs_step *step);

/* Pushes the clashes of a fate as a list; with `precursors` each tells which one it is in. */
void bsl_push_clashes(lua_State *L, const bs_clashes *clashes, bs_fate fate, bool precursors);

/* Sets the fields clashes, worries and reacting of the step's table at the top of the stack. */
void bsl_set_clashes(lua_State *L, const bs_step *step);

/* Pushes a step's table for a step of a route; its molecules are read when they are asked for. */
void bsl_push_route_step(lua_State *L, const bs_route *route, int index);

/* Pushes a number as it was written: 70 and not 70.0. */
void bsl_push_number(lua_State *L, double value);

/* Pushes a list of strings. */
void bsl_push_words(lua_State *L, const char *const *items, int count);

/* Pushes the value of a list of routes, which then owns it. */
void bsl_push_routes(lua_State *L, bs_routes *routes);

/* Pushes a copy of a route. */
void bsl_push_route(lua_State *L, const bs_route *route);

/* The list of routes, or the route, at index `i`, or an argument error. */
bs_routes *bsl_checkroutes(lua_State *L, int i);
bs_route *bsl_checkroute(lua_State *L, int i);

/* The constraints in the options at `i`, in the results arena; or NULL. */
const bs_constraints *bsl_read_constraints(lua_State *L, int i);

/* Tells a list of routes from which of the packs in use its steps come. */
bs_status bsl_name_packs(lua_State *L, bs_routes *routes);

/* The catalogue at index `i`, or NULL if it is none; raises if it is closed. */
bs_catalogue *bsl_testcatalogue(lua_State *L, int i);

/* Marks the catalogue at `i` (any other value is left alone) as in use by one search more or less. */
void bsl_lend_catalogue(lua_State *L, int i, int change);

/* Pushes an offer's table. */
void bsl_push_offer(lua_State *L, const bs_offer *offer);

/* Pushes a list of molecules. */
void bsl_push_mols(lua_State *L, bs_mol *const *mols, char *const *smiles, int count);

/* ---- Rules ----------------------------------------------------------------------------- */

/* Functions of rules, for calls of the rule layer. */
bs_rule_hooks bsl_session_hooks(bs_session *session);

/*
 * A lane: a state that is made, and reads packs, when a function is first called in it. One thread
 * at a time uses it. Start it as { .session = ... } and free it with bsl_lane_free().
 */
typedef struct bsl_lane {
    bs_session *session;
    bsl_host *host;
    bool *replayed; /* for each pack of the session */
} bsl_lane;

bs_rule_hooks bsl_lane_hooks(bsl_lane *lane);
void bsl_lane_free(bsl_lane *lane);

/* Whether the user's own code (not a pack) has defined functions of rules. */
bool bsl_has_own_hooks(const bs_session *session);

/* Remembers a function of the pack being read; returns its number. The function is at `i`. */
int bsl_keep_hook(lua_State *L, int i);

/* ---- Packs (pack.c) -------------------------------------------------------------------- */

/* Loads a pack by file (unless names_only) or name if it is not loaded yet, and gives its number;
   the fault says what went wrong. */
bs_status bsl_use(bs_session *session, const char *name, bool names_only, int *pack,
                  bsl_fault *fault);

/* Loads every pack of the standard library in the order of their names. */
bs_status bsl_use_library(bs_session *session, bsl_fault *fault);

/* Reads a pack again in a lane, for its functions. */
bs_status bsl_replay(bsl_host *lane, bs_ctx *cx, int pack, bsl_fault *fault);

/* The string field of the table at `i`, or NULL; the table keeps it alive. */
const char *bsl_text_field(lua_State *L, int i, const char *field);

/* The list of strings in a field of the table at `i`, in the results arena. */
bs_words bsl_words_field(lua_State *L, int i, const char *field);

/* The name of the pack that is being read, for definitions; NULL in the user's own code. */
const char *bsl_pack_name(const bsl_host *host);

/* Copies a string into the session's arena; raises when memory runs out. */
const char *bsl_keep(lua_State *L, const char *text, size_t length);

#endif
