/*
 * Reports: routes as JSON, out and in; the trace of a search.
 *
 * The form of the files is described in docs/routes.md. Compounds stand in them as canonical
 * SMILES. Costs and measures are written for other programs; a reader works them out again.
 */
#ifndef BACKSAW_REPORT_H
#define BACKSAW_REPORT_H

#include "backsaw/search.h"

/* The version of the form that is written; readers take it and those below it. */
#define BS_ROUTES_VERSION 1

/* Adds one route as a JSON object, ending in a newline. */
bs_status bs_route_json(const bs_route *route, bs_text *text);

/* Adds a list of routes with what is known of its search. */
bs_status bs_routes_json(const bs_routes *routes, bs_text *text);

/*
 * Writes a file, whole or not at all: a temporary file beside it takes its place when all is
 * written.
 *
 *   errors  BS_EFILE  with the path and the reason
 */
bs_status bs_write_file(bs_ctx *cx, const char *path, const char *data, size_t length);

/* bs_routes_json() into a file. */
bs_status bs_routes_save(bs_ctx *cx, const bs_routes *routes, const char *path);

/*
 * Reads a file of routes. Every step of a rule is run again with the rules given (or NULL: none),
 * which tells whether it is `checked`.
 *
 *   out     free with bs_routes_free()
 *   errors  BS_EFILE, BS_ELIMIT    cannot be read, larger than 256 MiB
 *           BS_ESYNTAX, BS_EVALUE  no JSON, or not what is expected: the message has the file, the
 *                                  line and the field, such as "routes[2].steps[1].yield"
 */
bs_status bs_routes_load(bs_ctx *cx, const char *path, const bs_rules *rules,
                         const bs_rule_hooks *hooks, bs_routes **out);

/* ---- Traces ------------------------------------------------------------------------------------ */

/* A file of JSON lines that grows while a search runs; see docs/routes.md. */
typedef struct bs_trace bs_trace;

/* Opens a file, or empties it. BS_EFILE with path and reason. The context is used to the end. */
bs_status bs_trace_open(bs_ctx *cx, const char *path, bs_trace **out);

/* Writes one line; for the trace of bs_plan_opts. */
bs_status bs_trace_event(bs_ctx *cx, bs_trace *trace, const bs_plan_event *event);

/* Writes what is left and closes, also where that fails; NULL is allowed. */
bs_status bs_trace_close(bs_ctx *cx, bs_trace *trace);

#endif
