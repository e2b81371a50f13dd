/*
 * Routes as JSON. That the text is JSON is judged by Jansson; that a file says the same as the
 * route, by reading it back. Costs are worked out by hand from the formula of route.h.
 */
#include "support/check.h"

#include "backsaw/report.h"

#include <jansson.h>
#include <stdio.h>
#include <stdlib.h>
#include <string.h>
#include <sys/stat.h>
#include <unistd.h>

/* CCBr + 3 N -> CCN (50 %, 10), CCO + Br -> CCBr (80 %, 4): (6.25 + 10) / 0.5 = 32.5 */
static const char sound[] =
    "{\n"
    "\"format\": \"backsaw routes\", \"version\": 1, \"target\": \"CCN\",\n"
    "\"complete\": true, \"packs\": [{\"name\": \"quay\", \"version\": \"1.0\"}],\n"
    "\"routes\": [\n"
    " {\"target\": \"NCC\", \"mode\": \"per mole\", \"cost\": 1,\n"
    "  \"molecules\": [\n"
    "   {\"smiles\": \"CCN\", \"bought\": false},\n"
    "   {\"smiles\": \"CCBr\", \"bought\": false},\n"
    "   {\"smiles\": \"N\", \"bought\": true, \"price\": 0},\n"
    "   {\"smiles\": \"Br\", \"bought\": true, \"price\": 0},\n"
    "   {\"smiles\": \"CCO\", \"bought\": true, \"price\": 1, \"offer\":\n"
    "     {\"smiles\": \"CCO\", \"code\": \"Q-1\", \"price_per_gram\": 0.02}}],\n"
    "  \"steps\": [\n"
    "   {\"product\": \"CCN\", \"precursors\": [\"BrCC\", \"N\"], \"known\": true, \"ways\": [\n"
    "     {\"transform\": \"amination \\\"a\\\"\", \"cost\": 10, \"yield\": 50,\n"
    "      \"equivalents\": [1, 3], \"cautions\": [\"ammonia\"]}]},\n"
    "   {\"product\": \"CCBr\", \"precursors\": [\"CCO\", \"Br\"], \"ways\": [\n"
    "     {\"transform\": \"bromination\", \"pack\": \"quay\", \"cost\": 4, \"yield\": 80,\n"
    "      \"equivalents\": [1, 1]}]}]}]}\n";

static void write_text(const char *path, const char *text, size_t length)
{
    FILE *file = fopen(path, "wb");

    assert_non_null(file);
    assert_int_equal(fwrite(text, 1, length, file), length);
    assert_int_equal(fclose(file), 0);
}

static char *temporary(char *path)
{
    int file;

    strcpy(path, "routes.XXXXXX");
    file = mkstemp(path);
    assert_true(file >= 0);
    close(file);
    return path;
}

static bs_status load(fixture *f, const char *text, bs_routes **out)
{
    char path[32];
    bs_status st;

    write_text(temporary(path), text, strlen(text));
    st = bs_routes_load(&f->cx, path, NULL, NULL, out);
    unlink(path);
    return st;
}

static void load__reads_a_route_and_works_out_its_cost(void **state)
{
    fixture *f = *state;
    bs_routes *list;
    const bs_route *route;

    check_ok(f, load(f, sound, &list));
    assert_int_equal(list->count, 1);
    assert_true(list->complete);
    assert_string_equal(list->packs[0].version, "1.0");
    route = list->items[0];
    assert_float_equal(route->cost, 32.5, 1e-12);
    assert_int_equal(route->step_count, 2);
    assert_string_equal(route->steps[1].ways[0].transform, "amination \"a\"");
    assert_string_equal(route->steps[1].ways[0].cautions.items[0], "ammonia");
    assert_true(route->steps[1].known);
    assert_false(route->steps[0].checked); /* there is no such rule */
    assert_string_equal(route->molecules[0].smiles, "CCN");
    for (int i = 0; i < route->molecule_count; i++) {
        if (strcmp(route->molecules[i].smiles, "CCO") == 0)
            assert_string_equal(route->molecules[i].offer.code, "Q-1");
    }
    bs_routes_free(&f->cx, list);
}

static void save__gives_back_the_same(void **state)
{
    fixture *f = *state;
    bs_routes *list, *again;
    bs_text first, second;
    json_t *parsed;
    char path[32];

    check_ok(f, load(f, sound, &list));
    check_ok(f, bs_routes_save(&f->cx, list, temporary(path)));
    check_ok(f, bs_routes_load(&f->cx, path, NULL, NULL, &again));
    assert_int_equal(again->count, 1);
    assert_true(bs_route_same(list->items[0], again->items[0]));
    bs_text_init(&first, &f->cx);
    bs_text_init(&second, &f->cx);
    check_ok(f, bs_routes_json(list, &first));
    check_ok(f, bs_routes_json(again, &second));
    assert_string_equal(first.data, second.data);
    parsed = json_loads(first.data, JSON_REJECT_DUPLICATES, NULL);
    assert_non_null(parsed);
    assert_float_equal(json_number_value(json_object_get(
                           json_array_get(json_object_get(parsed, "routes"), 0), "cost")),
                       32.5, 1e-12);
    json_decref(parsed);
    bs_text_free(&first);
    bs_text_free(&second);
    bs_routes_free(&f->cx, list);
    bs_routes_free(&f->cx, again);
    unlink(path);
}

/* The sound text with the first `from` replaced by `to`. */
static void edit(const char *from, const char *to, char *out, size_t size)
{
    const char *at = strstr(sound, from);

    assert_non_null(at);
    snprintf(out, size, "%.*s%s%s", (int)(at - sound), sound, to, at + strlen(from));
}

static void load__names_line_and_field_of_what_is_wrong(void **state)
{
    fixture *f = *state;
    static const struct {
        const char *from, *to, *message;
    } cases[] = {
        {"\"version\": 1,", "\"version\": 2,", "line 2: version: written by a newer program"},
        {"\"version\": 1,", "", "version: is missing"},
        {"backsaw routes", "other", "line 2: format: "},
        {"\"mode\": \"per mole\"", "\"mode\": \"dear\"", "line 5: routes[1].mode: "},
        {"{\"smiles\": \"CCN\", \"bought\": false}", "3", "line 7: routes[1].molecules[1]: "},
        {"\"smiles\": \"CCN\"", "\"smiles\": \"CC(N\"", "line 7: routes[1].molecules[1].smiles: "},
        {"\"smiles\": \"CCBr\"", "\"smiles\": \"NCC\"",
         "line 8: routes[1].molecules[2].smiles: this compound stands in the list already"},
        {"\"smiles\": \"CCBr\", \"bought\": false", "\"smiles\": \"CCBr\", \"bought\": \"no\"",
         "line 8: routes[1].molecules[2].bought: true or false"},
        {"\"price\": 0}", "\"price\": -1}", "line 9: routes[1].molecules[3].price: a number of 0"},
        {", \"price\": 0}", "}", "line 9: routes[1].molecules[3].price: is missing"},
        {"\"bought\": true, \"price\": 0", "\"bought\": false", "line 9: routes[1].molecules[3]"},
        {"\"code\": \"Q-1\"", "\"code\": 1", "line 12: routes[1].molecules[5].offer.code: "},
        {"[\"BrCC\"", "[\"ICC\"", "line 14: routes[1].steps[1].precursors[1]: "},
        {"[\"BrCC\", \"N\"]", "[\"N\", \"N\"]", "line 14: routes[1].steps[1].precursors[2]: "},
        {"\"yield\": 50", "\"yield\": 0", "line 15: routes[1].steps[1].ways[1].yield: "},
        {"\"yield\": 50", "\"yield\": 101", "line 15: routes[1].steps[1].ways[1].yield: "},
        {"[1, 3]", "[1]", "line 16: routes[1].steps[1].ways[1].equivalents: "},
        {"[1, 3]", "[1, 0]", "line 16: routes[1].steps[1].ways[1].equivalents: "},
        {"[\"ammonia\"]", "[7]", "line 16: routes[1].steps[1].ways[1].cautions[1]: "},
        {"[\"CCO\", \"Br\"]", "[\"CCN\", \"Br\"]", "line 5: routes[1]: "},
        {"\"routes\": [", "\"routes\": {} , \"x\": [", "line 4: routes: a list is expected"},
        {"{\n", "", "line 1: no JSON: "},
        {"\"complete\": true", "\"complete\": true, \"complete\": true", "line 3: no JSON: "},
    };

    for (size_t i = 0; i < sizeof cases / sizeof *cases; i++) {
        char text[4096];
        bs_routes *list;

        edit(cases[i].from, cases[i].to, text, sizeof text);
        assert_int_not_equal(load(f, text, &list), BS_OK);
        assert_null(list);
        if (!strstr(f->cx.error.message, cases[i].message) || strchr(f->cx.error.message, '\n'))
            fail_msg("'%s' is not in '%s'", cases[i].message, f->cx.error.message);
    }
}

/* Every byte left out, and replaced by others: an error or a sound list, never a crash or a leak.
 */
static void load__survives_damage(void **state)
{
    fixture *f = *state;
    static const char put[] = "\"]";
    char text[sizeof sound];
    long failed = 0;

    for (size_t i = 0; i < strlen(sound); i++) {
        for (size_t k = 0; k < sizeof put; k++) {
            bs_routes *list;

            memcpy(text, sound, sizeof sound);
            if (put[k])
                text[i] = put[k];
            else
                memmove(text + i, text + i + 1, sizeof sound - i - 1);
            if (load(f, text, &list) == BS_OK)
                bs_routes_free(&f->cx, list);
            else
                failed++;
        }
    }
    assert_true(failed > 1000);
}

static void load__fails_when_memory_runs_out(void **state)
{
    fixture *f = *state;
    char path[32];
    int count = 0;

    write_text(temporary(path), sound, sizeof sound - 1);
    for (;; count++) {
        bs_routes *list;
        bs_status st;

        atomic_store(&f->cx.gate->fail_after, count);
        st = bs_routes_load(&f->cx, path, NULL, NULL, &list);
        atomic_store(&f->cx.gate->fail_after, -1);
        if (st == BS_OK) {
            bs_routes_free(&f->cx, list);
            break;
        }
        assert_int_equal(st, BS_ENOMEM);
        assert_null(list);
    }
    check_requests(count, 50);
    unlink(path);
}

static void write_file__leaves_nothing_behind_when_it_fails(void **state)
{
    fixture *f = *state;
    char folder[] = "folder.XXXXXX", path[64];

    assert_int_equal(bs_write_file(&f->cx, "no-such-folder/x.json", "x", 1), BS_EFILE);
    assert_non_null(strstr(f->cx.error.message, "no-such-folder/x.json"));
    /* A folder cannot be replaced by a file; the temporary file must be gone, or rmdir fails. */
    assert_non_null(mkdtemp(folder));
    snprintf(path, sizeof path, "%s/x.json", folder);
    assert_int_equal(mkdir(path, 0700), 0);
    assert_int_equal(bs_write_file(&f->cx, path, "x", 1), BS_EFILE);
    assert_int_equal(rmdir(path), 0);
    assert_int_equal(rmdir(folder), 0);
}

/* RFC 8259: control characters are escaped; Unicode 15, 3.9: an ill-formed byte becomes U+FFFD. */
static void json__escapes_what_strings_cannot_hold(void **state)
{
    fixture *f = *state;
    double one[] = {1};
    int from[] = {1};
    bs_route_molecule mols[] = {{.smiles = "CC", .price = -1, .offer = {.price_per_gram = -1}},
                                {.smiles = "C", .price = 0.1, .offer = {.price_per_gram = -1}}};
    bs_route_way way = {
        .transform = "a\"\\\n\x01\xC3\xA9\xFF z", .cost = 0.1, .yield = 50, .equivalents = one};
    bs_route_step step = {
        .product = 0, .precursors = from, .precursor_count = 1, .ways = &way, .way_count = 1};
    bs_route *route;
    bs_text text;
    json_t *parsed, *ways;

    check_ok(f, bs_route_build(&f->cx, &f->home, BS_COST_ADDITIVE, mols, 2, &step, 1, 0, &route));
    bs_text_init(&text, &f->cx);
    check_ok(f, bs_route_json(route, &text));
    parsed = json_loads(text.data, 0, NULL);
    assert_non_null(parsed);
    ways = json_object_get(json_array_get(json_object_get(parsed, "steps"), 0), "ways");
    assert_string_equal(json_string_value(json_object_get(json_array_get(ways, 0), "transform")),
                        "a\"\\\n\x01\xC3\xA9\xEF\xBF\xBD z");
    assert_true(json_number_value(json_object_get(parsed, "cost")) == 0.1 + 0.1);
    assert_non_null(strstr(text.data, "\"price\": 0.1,")); /* no more digits than needed */
    json_decref(parsed);
    bs_text_free(&text);
}

static void merge__puts_each_route_once_and_by_cost(void **state)
{
    fixture *f = *state;
    bs_routes *a, *b, *merged;
    char text[4096];

    check_ok(f, load(f, sound, &a));
    edit("\"complete\": true", "\"complete\": false, \"reason\": \"why\"", text, sizeof text);
    check_ok(f, load(f, text, &b));
    check_ok(f, bs_routes_merge(&f->cx, a, b, &merged));
    assert_int_equal(merged->count, 1);
    assert_false(merged->complete);
    assert_string_equal(merged->reason, "why");
    assert_int_equal(merged->pack_count, 1);
    bs_routes_free(&f->cx, merged);
    bs_routes_free(&f->cx, b);
    edit("amination", "other amination", text, sizeof text); /* a known step of its own */
    check_ok(f, load(f, text, &b));
    check_ok(f, bs_routes_merge(&f->cx, a, b, &merged));
    assert_int_equal(merged->count, 2);
    bs_routes_free(&f->cx, merged);
    bs_routes_free(&f->cx, b);
    edit("per mole", "additive", text, sizeof text);
    check_ok(f, load(f, text, &b));
    assert_int_equal(bs_routes_merge(&f->cx, a, b, &merged), BS_EVALUE);
    bs_routes_free(&f->cx, b);
    edit("\"target\": \"CCN\"", "\"target\": \"CCO\"", text, sizeof text);
    check_ok(f, load(f, text, &b));
    assert_int_equal(bs_routes_merge(&f->cx, a, b, &merged), BS_EVALUE);
    bs_routes_free(&f->cx, b);
    bs_routes_free(&f->cx, a);
}

int main(void)
{
    const struct CMUnitTest tests[] = {
        check_case(load__reads_a_route_and_works_out_its_cost),
        check_case(save__gives_back_the_same),
        check_case(load__names_line_and_field_of_what_is_wrong),
        check_case(load__survives_damage),
        check_case(load__fails_when_memory_runs_out),
        check_case(write_file__leaves_nothing_behind_when_it_fails),
        check_case(json__escapes_what_strings_cannot_hold),
        check_case(merge__puts_each_route_once_and_by_cost),
    };

    return cmocka_run_group_tests_name("report.json", tests, NULL, NULL);
}
