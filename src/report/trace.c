/* The trace of a search, one JSON object a line; see docs/routes.md. */
#include "backsaw/report.h"

#include "report/json.h"

#include <errno.h>
#include <fcntl.h>
#include <math.h>
#include <string.h>
#include <unistd.h>

#define FLUSH_BYTES 65536

struct bs_trace {
    bs_text text; /* lines not written yet */
    char *path;
    bs_arena home;
    int file;
};

bs_status bs_trace_open(bs_ctx *cx, const char *path, bs_trace **out)
{
    bs_trace *trace = bs_gate_alloc(cx->gate, sizeof *trace);
    bs_status st;

    *out = NULL;
    if (!trace)
        return bs_fail_memory(cx);
    bs_text_init(&trace->text, cx);
    bs_arena_init(&trace->home, cx->gate);
    trace->file = -1;
    st = bs_copy_text(cx, &trace->home, path, strlen(path), &trace->path);
    if (st == BS_OK) {
        trace->file = open(path, O_WRONLY | O_CREAT | O_TRUNC | O_CLOEXEC, 0666);
        if (trace->file < 0)
            st = bs_fail(cx, BS_EFILE, "%s: cannot be written: %s", path, strerror(errno));
    }
    if (st != BS_OK)
        bs_trace_close(cx, trace);
    else
        *out = trace;
    return st;
}

static bs_status flush_lines(bs_ctx *cx, bs_trace *trace)
{
    const char *data = trace->text.data;
    size_t left = trace->text.length;

    while (left > 0) {
        ssize_t written = write(trace->file, data, left);

        if (written < 0 && errno == EINTR)
            continue;
        if (written <= 0)
            return bs_fail(cx, BS_EFILE, "%s: cannot be written: %s", trace->path, strerror(errno));
        data += written;
        left -= (size_t)written;
    }
    bs_text_clear(&trace->text);
    return BS_OK;
}

bs_status bs_trace_close(bs_ctx *cx, bs_trace *trace)
{
    bs_status st = BS_OK;

    if (!trace)
        return BS_OK;
    if (trace->file >= 0) {
        st = flush_lines(cx, trace);
        close(trace->file);
    }
    bs_text_free(&trace->text);
    bs_arena_free(&trace->home);
    bs_gate_free(cx->gate, trace, sizeof *trace);
    return st;
}

/* ---- Events ---------------------------------------------------------------------------------- */

static void add_step(bs_json *json, const bs_plan_event *event)
{
    const bs_route *route = event->route;
    const bs_route_step *step = &route->steps[0];

    bs_json__string_field(json, "product", route->molecules[step->product].smiles);
    bs_json__key(json, "precursors");
    bs_json__open(json, '[');
    for (int i = 0; i < step->precursor_count; i++)
        bs_json__string(json, route->molecules[step->precursors[i]].smiles);
    bs_json__close(json, ']');
    bs_json__string_field(json, "transform", step->ways[0].transform);
    bs_json__flag_field(json, "known", step->known);
    bs_json__number_field(json, "cost", step->ways[0].cost);
    bs_json__string_field(json, "verdict", event->verdict);
}

static void add_look(bs_json *json, const bs_plan_progress *now)
{
    bs_json__number_field(json, "molecules", (double)now->molecules);
    bs_json__number_field(json, "expanded", (double)now->expanded);
    bs_json__number_field(json, "steps", (double)now->steps);
    bs_json__number_field(json, "open", (double)now->open);
    if (isfinite(now->cheapest))
        bs_json__number_field(json, "cheapest", now->cheapest);
}

static void add_end(bs_json *json, const bs_routes *routes)
{
    bs_json__number_field(json, "routes", routes->count);
    bs_json__flag_field(json, "complete", routes->complete);
    bs_json__string_field(json, "reason", routes->reason);
}

bs_status bs_trace_event(bs_ctx *cx, bs_trace *trace, const bs_plan_event *event)
{
    static const char *const names[] = {"molecule", "step", "look", "route", "end"};
    bs_json json = {.text = &trace->text};

    bs_json__open_line(&json, '{');
    bs_json__string_field(&json, "event", names[event->kind]);
    switch (event->kind) {
    case BS_EVENT_MOLECULE:
        bs_json__string_field(&json, "smiles", event->smiles);
        if (isfinite(event->price))
            bs_json__number_field(&json, "price", event->price);
        break;
    case BS_EVENT_STEP:
        add_step(&json, event);
        break;
    case BS_EVENT_LOOK:
        add_look(&json, event->now);
        break;
    case BS_EVENT_ROUTE:
        bs_json__number_field(&json, "cost", event->route->cost);
        bs_json__number_field(&json, "rank", event->route->rank);
        bs_json__number_field(&json, "steps", event->route->step_count);
        break;
    case BS_EVENT_END:
        add_end(&json, event->routes);
        break;
    }
    bs_json__close(&json, '}');
    if (json.status == BS_OK)
        json.status = bs_text_putc(&trace->text, '\n');
    return json.status == BS_OK && trace->text.length >= FLUSH_BYTES ? flush_lines(cx, trace)
                                                                     : json.status;
}
