/* Routes as JSON: the form of docs/routes.md. */
#include "backsaw/report.h"

#include "report/json.h"

#include <errno.h>
#include <fcntl.h>
#include <stdio.h>
#include <string.h>
#include <unistd.h>

/* ---- A route --------------------------------------------------------------------------------- */

static void add_offer(bs_json *json, const bs_offer *offer)
{
    bs_json__key(json, "offer");
    bs_json__open(json, '{');
    bs_json__string_field(json, "smiles", offer->smiles);
    bs_json__string_field(json, "code", offer->code);
    bs_json__string_field(json, "name", offer->name);
    if (offer->price_per_gram >= 0)
        bs_json__number_field(json, "price_per_gram", offer->price_per_gram);
    if (offer->container_g >= 0)
        bs_json__number_field(json, "container_g", offer->container_g);
    if (offer->lead_days >= 0)
        bs_json__number_field(json, "lead_days", offer->lead_days);
    bs_json__string_field(json, "ground", offer->ground);
    bs_json__close(json, '}');
}

static void add_molecule(bs_json *json, const bs_route_molecule *mol)
{
    bs_json__open_line(json, '{');
    bs_json__string_field(json, "smiles", mol->smiles);
    bs_json__flag_field(json, "bought", mol->bought);
    if (mol->bought)
        bs_json__number_field(json, "price", mol->price);
    bs_json__number_field(json, "cost", mol->cost);
    bs_json__number_field(json, "moles", mol->moles);
    if (mol->offer.smiles)
        add_offer(json, &mol->offer);
    bs_json__close(json, '}');
}

static void add_numbers(bs_json *json, const char *key, const double *items, int count)
{
    bs_json__key(json, key);
    bs_json__open_line(json, '[');
    for (int i = 0; i < count; i++)
        bs_json__number(json, items[i]);
    bs_json__close(json, ']');
}

static void add_way(bs_json *json, const bs_route_way *way, int precursors)
{
    double range[2] = {way->yield_low, way->yield_high};

    bs_json__open(json, '{');
    bs_json__string_field(json, "transform", way->transform);
    bs_json__string_field(json, "pack", way->pack);
    bs_json__string_field(json, "conditions", way->conditions);
    bs_json__string_field(json, "recipe", way->recipe);
    bs_json__string_field(json, "source", way->source);
    bs_json__strings_field(json, "cautions", way->cautions.items, way->cautions.count);
    bs_json__strings_field(json, "reagents", way->reagents.items, way->reagents.count);
    bs_json__number_field(json, "cost", way->cost);
    bs_json__number_field(json, "yield", way->yield);
    if (way->yield_low > 0 || way->yield_high > 0)
        add_numbers(json, "yield_range", range, 2);
    add_numbers(json, "equivalents", way->equivalents, precursors);
    bs_json__close(json, '}');
}

static void add_step(bs_json *json, const bs_route *route, const bs_route_step *step)
{
    bs_json__open(json, '{');
    bs_json__string_field(json, "product", route->molecules[step->product].smiles);
    bs_json__key(json, "precursors");
    bs_json__open_line(json, '[');
    for (int i = 0; i < step->precursor_count; i++)
        bs_json__string(json, route->molecules[step->precursors[i]].smiles);
    bs_json__close(json, ']');
    bs_json__flag_field(json, "known", step->known);
    bs_json__flag_field(json, "checked", step->checked);
    bs_json__strings_field(json, "rivals", (const char *const *)step->rivals, step->rival_count);
    bs_json__strings_field(json, "clashes", (const char *const *)step->clashes, step->clash_count);
    bs_json__strings_field(json, "clashes", (const char *const *)step->clashes, step->clash_count);
    bs_json__key(json, "ways");
    bs_json__open(json, '[');
    for (int i = 0; i < step->way_count; i++)
        add_way(json, &step->ways[i], step->precursor_count);
    bs_json__close(json, ']');
    bs_json__close(json, '}');
}

static void add_measures(bs_json *json, const bs_route *route)
{
    bs_route_measures m;

    bs_route_measure(route, &m);
    bs_json__key(json, "measures");
    bs_json__open_line(json, '{');
    bs_json__number_field(json, "steps", m.steps);
    bs_json__number_field(json, "runs", m.runs);
    bs_json__number_field(json, "longest", m.longest);
    bs_json__number_field(json, "leaves", m.leaves);
    bs_json__number_field(json, "yield_low", m.yield_low);
    bs_json__number_field(json, "yield", m.yield);
    bs_json__number_field(json, "yield_high", m.yield_high);
    bs_json__flag_field(json, "checked", m.checked);
    bs_json__close(json, '}');
}

static void add_route(bs_json *json, const bs_route *route)
{
    bs_json__open(json, '{');
    bs_json__string_field(json, "target", route->molecules[0].smiles);
    bs_json__string_field(json, "mode", route->mode == BS_COST_ADDITIVE ? "additive" : "per mole");
    bs_json__number_field(json, "cost", route->cost);
    bs_json__number_field(json, "rank", route->rank);
    add_measures(json, route);
    bs_json__key(json, "molecules");
    bs_json__open(json, '[');
    for (int i = 0; i < route->molecule_count; i++)
        add_molecule(json, &route->molecules[i]);
    bs_json__close(json, ']');
    bs_json__key(json, "steps");
    bs_json__open(json, '[');
    for (int i = 0; i < route->step_count; i++)
        add_step(json, route, &route->steps[i]);
    bs_json__close(json, ']');
    bs_json__close(json, '}');
}

static bs_status end(bs_json *json)
{
    return json->status == BS_OK ? bs_text_putc(json->text, '\n') : json->status;
}

bs_status bs_route_json(const bs_route *route, bs_text *text)
{
    bs_json json = {.text = text};

    add_route(&json, route);
    return end(&json);
}

/* ---- A list ------------------------------------------------------------------------------------
 */

static void add_packs(bs_json *json, const bs_routes *routes)
{
    bs_json__key(json, "packs");
    bs_json__open(json, '[');
    for (int i = 0; i < routes->pack_count; i++) {
        const bs_pack_name *pack = &routes->packs[i];

        bs_json__open_line(json, '{');
        bs_json__string_field(json, "name", pack->name);
        bs_json__string_field(json, "version", pack->version);
        bs_json__close(json, '}');
    }
    bs_json__close(json, ']');
}

static void add_gaps(bs_json *json, const bs_routes *routes)
{
    bs_json__key(json, "gaps");
    bs_json__open(json, '[');
    for (int i = 0; i < routes->gap_count; i++) {
        const bs_gap *gap = &routes->gaps[i];

        bs_json__open_line(json, '{');
        bs_json__string_field(json, "smiles", gap->smiles);
        bs_json__number_field(json, "opens", gap->opens);
        bs_json__flag_field(json, "opens_target", gap->opens_target);
        bs_json__number_field(json, "steps", gap->steps);
        bs_json__close(json, '}');
    }
    bs_json__close(json, ']');
}

bs_status bs_routes_json(const bs_routes *routes, bs_text *text)
{
    bs_json json = {.text = text};

    bs_json__open(&json, '{');
    bs_json__string_field(&json, "format", "backsaw routes");
    bs_json__number_field(&json, "version", BS_ROUTES_VERSION);
    bs_json__string_field(&json, "target", routes->target);
    bs_json__flag_field(&json, "complete", routes->complete);
    bs_json__string_field(&json, "reason", routes->reason);
    bs_json__strings_field(&json, "warnings", routes->warnings, routes->warning_count);
    bs_json__key(&json, "explored");
    bs_json__open_line(&json, '{');
    bs_json__number_field(&json, "molecules", (double)routes->molecules);
    bs_json__number_field(&json, "expanded", (double)routes->expanded);
    bs_json__number_field(&json, "steps", (double)routes->steps);
    bs_json__close(&json, '}');
    add_packs(&json, routes);
    add_gaps(&json, routes);
    bs_json__key(&json, "routes");
    bs_json__open(&json, '[');
    for (int i = 0; i < routes->count; i++)
        add_route(&json, routes->items[i]);
    bs_json__close(&json, ']');
    bs_json__close(&json, '}');
    return end(&json);
}

/* ---- Files
 * --------------------------------------------------------------------------------------- */

static bool write_all(int file, const char *data, size_t length)
{
    while (length > 0) {
        ssize_t written = write(file, data, length);

        if (written < 0 && errno == EINTR)
            continue;
        if (written <= 0)
            return false;
        data += written;
        length -= (size_t)written;
    }
    return true;
}

/* Makes a file that is not there yet; its name in `name`, which has room for a number. */
static int make_beside(const char *path, char *name, size_t size)
{
    int file = -1;

    for (int i = 0; i < 1000 && file < 0; i++) {
        snprintf(name, size, "%s.%ld-%d", path, (long)getpid(), i);
        file = open(name, O_WRONLY | O_CREAT | O_EXCL | O_CLOEXEC, 0666);
        if (file < 0 && errno != EEXIST)
            break;
    }
    return file;
}

bs_status bs_write_file(bs_ctx *cx, const char *path, const char *data, size_t length)
{
    bs_mark temp = bs_arena_mark(&cx->scratch);
    size_t room = strlen(path) + 48;
    char *name;
    int file;
    bs_status st = bs_new(cx, &cx->scratch, room, &name);

    if (st != BS_OK)
        return st;
    file = make_beside(path, name, room);
    if (file < 0) {
        st = bs_fail(cx, BS_EFILE, "%s: cannot be written: %s", path, strerror(errno));
    } else {
        if (!write_all(file, data, length) || fsync(file) != 0 || rename(name, path) != 0) {
            st = bs_fail(cx, BS_EFILE, "%s: cannot be written: %s", path, strerror(errno));
            unlink(name);
        }
        close(file);
    }
    bs_arena_rewind(&cx->scratch, temp);
    return st;
}

bs_status bs_routes_save(bs_ctx *cx, const bs_routes *routes, const char *path)
{
    bs_text text;
    bs_status st;

    bs_text_init(&text, cx);
    if ((st = bs_routes_json(routes, &text)) == BS_OK)
        st = bs_write_file(cx, path, text.data, text.length);
    bs_text_free(&text);
    return st;
}
