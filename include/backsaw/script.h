/*
 * Scripts: a session is a Lua 5.4 interpreter with chemistry inside, the rules in use, and the
 * packs that brought them. The user's own code runs in the main state with all of Lua; packs run
 * in a state of their own, with little more than the words for defining rules.
 *
 * A session belongs to one thread. A call that fails leaves a text for people in
 * bs_session_message(): where, what, and the offending line with a caret where there is one.
 */
#ifndef BACKSAW_SCRIPT_H
#define BACKSAW_SCRIPT_H

#include "backsaw/search.h"

#define BACKSAW_VERSION "0.1.0"

typedef struct bs_session bs_session;

typedef struct bs_session_opts {
    const char *program_folder; /* where the program lies, to find the standard library; or NULL */
    const char *script_folder;  /* where the script lies, to find packs beside it; or NULL */
    const char *pack_path;      /* folders to find packs in, separated by colons; or NULL */
    bool bare;                  /* leave the standard library out */
    bool later;                 /* the command that is run loads the standard library itself */
    void *payload;
    void (*progress)(void *payload, const bs_plan_progress *now); /* NULL `now`: the plan ended */
    void (*say)(void *payload, const char *line); /* what packs print; NULL drops it */
} bs_session_opts;

/*
 * Makes a session and loads the standard library unless `bare`. *out is a session even after a
 * failure (unless memory ran out), so that the message can be read; free it.
 */
bs_status bs_session_new(const bs_session_opts *opts, bs_session **out);

/* NULL is allowed. */
void bs_session_free(bs_session *session);

/* The text for the last failure: one line or several, without an end of line behind. */
const char *bs_session_message(const bs_session *session);

/* Sets the global `arg` and the arguments of the next script; arg[0] is `script`. */
bs_status bs_session_arguments(bs_session *session, const char *script, int count,
                               char *const *arguments);

/* Runs a file, or standard input if `path` is NULL. A first line that starts with # is skipped. */
bs_status bs_session_run_file(bs_session *session, const char *path);

/* Runs a text under a name for messages. */
bs_status bs_session_run_text(bs_session *session, const char *name, const char *text,
                              size_t length);

/*
 * Runs what was typed at a prompt: an expression, whose values are printed, or statements. If the
 * text is the beginning of something longer, *incomplete is true and nothing runs.
 */
bs_status bs_session_enter(bs_session *session, const char *text, size_t length, bool *incomplete);

/* Loads a pack by file or by name, as `use` does. */
bs_status bs_session_use(bs_session *session, const char *pack);

/* Runs a command that is written in Lua ("check", ...); *exit_status is its verdict. */
bs_status bs_session_command(bs_session *session, const char *name, int count,
                             char *const *arguments, int *exit_status);

/*
 * Global names that start with `prefix`, or the methods behind a last dot or colon, sorted; an
 * array of `*count` strings in `home`. Used to complete what is typed.
 */
bs_status bs_session_complete(bs_session *session, bs_arena *home, const char *prefix,
                              char ***names, int *count);

/* Asks the running call to stop. May be called from a signal handler. */
void bs_session_interrupt(bs_session *session);

#endif
