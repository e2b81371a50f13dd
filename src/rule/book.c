/* The rule book: definitions, names, and compiling them into cases. */
#include "rule/book.h"

#include <stdio.h>
#include <stdlib.h>
#include <string.h>

bs_status bs_blame(bs_ctx *cx, bs_status status, const char *field)
{
    char message[BS_MESSAGE_MAX];
    size_t used;

    snprintf(message, sizeof message, "%s: ", field);
    used = strlen(message);
    snprintf(message + used, sizeof message - used, "%.*s", (int)(sizeof message - used - 1),
             cx->error.message);
    memcpy(cx->error.message, message, sizeof message);
    return status;
}

/* ---- Life --------------------------------------------------------------------------------------
 */

bs_status bs_rules_new(bs_ctx *cx, bs_rules **out)
{
    bs_rules *rules = bs_gate_alloc(cx->gate, sizeof *rules);

    *out = rules;
    if (!rules)
        return bs_fail_memory(cx);
    rules->gate = cx->gate;
    bs_arena_init(&rules->arena, cx->gate);
    bs_shelves__init(&rules->shelves, cx->gate);
    return BS_OK;
}

void bs_rules_free(bs_rules *rules)
{
    if (!rules)
        return;
    bs_shelves__free(&rules->shelves);
    bs_arena_free(&rules->arena);
    bs_gate_free(rules->gate, rules, sizeof *rules);
}

/* ---- Names
 * --------------------------------------------------------------------------------------- */

bs_status bs_book__fold_name(bs_ctx *cx, bs_arena *home, const char *name, char **out)
{
    size_t length = 0;
    bs_status st = bs_new(cx, home, strlen(name) + 1, out);

    for (const char *c = name; *c && st == BS_OK; c++) {
        if (*c == ' ' || *c == '-' || *c == '\t')
            continue;
        (*out)[length++] = (char)(*c >= 'A' && *c <= 'Z' ? *c + ('a' - 'A') : *c);
    }
    return st;
}

static const bs_synthon *find_synthon(const bs_rules *rules, const char *key)
{
    for (int i = 0; i < rules->synthon_count; i++) {
        if (!rules->synthons[i]->retired && strcmp(rules->synthons[i]->key, key) == 0)
            return rules->synthons[i];
    }
    return NULL;
}

static int find_key(const bs_rules *rules, const char *key)
{
    for (int i = 0; i < rules->transform_count; i++) {
        const bs_transform *tr = rules->transforms[i];

        for (int k = 0; k < tr->key_count; k++) {
            if (strcmp(tr->keys[k], key) == 0)
                return i;
        }
    }
    return -1;
}

/* The next byte of a name that counts, folded; 0 at the end. */
static int next_byte(const char **name)
{
    while (**name == ' ' || **name == '-' || **name == '\t')
        (*name)++;
    if (**name == 0)
        return 0;
    return **name >= 'A' && **name <= 'Z' ? *(*name)++ + ('a' - 'A') : *(*name)++;
}

bool bs_book__same_name(const char *a, const char *b)
{
    int x, y;

    do {
        x = next_byte(&a);
        y = next_byte(&b);
    } while (x == y && x != 0);
    return x == y;
}

int bs_rules_find(const bs_rules *rules, const char *name)
{
    for (int i = 0; i < rules->transform_count; i++) {
        const bs_transform *tr = rules->transforms[i];

        for (int k = 0; k < tr->key_count; k++) {
            if (bs_book__same_name(name, tr->keys[k]))
                return i;
        }
    }
    return -1;
}

int bs_rules_count(const bs_rules *rules)
{
    return rules->transform_count;
}

const bs_transform_def *bs_rules_transform(const bs_rules *rules, int index)
{
    return &rules->transforms[index]->def;
}

int bs_rules_synthon_count(const bs_rules *rules)
{
    return rules->synthon_count;
}

const bs_synthon_def *bs_rules_synthon(const bs_rules *rules, int index)
{
    const bs_synthon *synthon = rules->synthons[index];

    return synthon->retired ? NULL : &synthon->def;
}

/* ---- Taking back ----------------------------------------------------------------------- */

bs_rules_mark bs_rules_grown(const bs_rules *rules)
{
    bs_rules_mark mark = {.synthons = rules->synthon_count,
                          .transforms = rules->transform_count,
                          .preferences = rules->preference_count};

    bs_shelves__mark(&rules->shelves, &mark);
    return mark;
}

void bs_rules_rewind(bs_rules *rules, bs_rules_mark mark)
{
    if (mark.synthons < rules->synthon_count)
        rules->synthon_count = mark.synthons;
    if (mark.transforms < rules->transform_count)
        rules->transform_count = mark.transforms;
    if (mark.preferences < rules->preference_count)
        rules->preference_count = mark.preferences;
    bs_shelves__rewind(&rules->shelves, mark);
}

void bs_rules_retire_transform(bs_rules *rules, int index, bool retired)
{
    bs_transform *tr = rules->transforms[index];

    if (tr->retired == retired)
        return;
    if (retired) {
        tr->kept_keys = tr->key_count;
        tr->kept_cases = tr->case_count;
    }
    tr->key_count = retired ? 0 : tr->kept_keys;
    tr->case_count = retired ? 0 : tr->kept_cases;
    tr->retired = retired;
}

/* The newest of a name is meant: older ones were retired before it could be added. */
void bs_rules_retire_synthon(bs_rules *rules, const char *name, bool retired)
{
    for (int i = rules->synthon_count - 1; i >= 0; i--) {
        if (!bs_book__same_name(name, rules->synthons[i]->key))
            continue;
        rules->synthons[i]->retired = retired;
        return;
    }
}

/* ---- Copies of definitions
 * ----------------------------------------------------------------------- */

bs_status bs_rules__copy_string(bs_ctx *cx, bs_arena *home, const char **string)
{
    char *copy;
    bs_status st;

    if (!*string)
        return BS_OK;
    if ((st = bs_copy_text(cx, home, *string, strlen(*string), &copy)) == BS_OK)
        *string = copy;
    return st;
}

bs_status bs_rules__copy_words(bs_ctx *cx, bs_arena *home, bs_words *words)
{
    const char **items;
    bs_status st;

    if (words->count <= 0 || !words->items) {
        *words = (bs_words){0};
        return BS_OK;
    }
    if ((st = bs_new(cx, home, words->count, &items)) != BS_OK)
        return st;
    for (int i = 0; i < words->count && st == BS_OK; i++) {
        items[i] = words->items[i];
        st = bs_rules__copy_string(cx, home, &items[i]);
    }
    words->items = items;
    return st;
}

static bs_status copy_transform(bs_ctx *cx, bs_arena *home, bs_transform_def *def)
{
    const char **strings[] = {&def->name,  &def->target,     &def->from,   &def->acceptor,
                              &def->donor, &def->conditions, &def->recipe, &def->source,
                              &def->rxno,  &def->pack,       &def->origin, &def->prefer};
    bs_words *lists[] = {&def->also, &def->spares, &def->also_attacks, &def->cautions,
                         &def->reagents};
    bs_status st = BS_OK;

    for (size_t i = 0; i < sizeof strings / sizeof *strings && st == BS_OK; i++)
        st = bs_rules__copy_string(cx, home, strings[i]);
    for (size_t i = 0; i < sizeof lists / sizeof *lists && st == BS_OK; i++)
        st = bs_rules__copy_words(cx, home, lists[i]);
    return st;
}

/* ---- Synthons
 * ------------------------------------------------------------------------------------- */

static bs_status copy_equivalents(bs_ctx *cx, bs_arena *home, bs_synthon_def *def)
{
    bs_equivalent_def *items;
    bs_status st = bs_new(cx, home, def->equivalent_count + 1, &items);

    for (int i = 0; i < def->equivalent_count && st == BS_OK; i++) {
        items[i] = def->equivalents[i];
        if ((items[i].attach != NULL) == (items[i].rewrite != NULL))
            return bs_fail(cx, BS_EVALUE,
                           "equivalents: number %d needs either attach or rewrite", i + 1);
        if ((st = bs_rules__copy_string(cx, home, &items[i].attach)) == BS_OK &&
            (st = bs_rules__copy_string(cx, home, &items[i].rewrite)) == BS_OK)
            st = bs_rules__copy_string(cx, home, &items[i].name);
    }
    def->equivalents = items;
    return st;
}

/* Compiles every equivalent once against a bare bond, so that mistakes are found here. */
static bs_status try_synthon(bs_ctx *cx, bs_arena *home, const bs_synthon *synthon)
{
    static const bs_equivalent_def hydrogen = {.attach = "[H]"};
    bs_synthon other = {.def = {.equivalents = &hydrogen, .equivalent_count = 1}};
    bs_transform_def def = {.cut = {1, 2}, .acceptor_map = 1, .donor_map = 2};
    bs_query *target;
    bs_case *cases;
    int count;
    bs_status st = bs_query_read(cx, home, "[*:1]~[*:2]", 11, 0, &target);

    if (st != BS_OK)
        return st;
    return bs_compose__cut(cx, home, target, &def, synthon, &other, &cases, &count);
}

static bs_status make_synthon(bs_ctx *cx, bs_rules *rules, const bs_synthon_def *def,
                              bs_synthon **out)
{
    bs_synthon *synthon;
    bs_mark trial;
    bs_status st;

    if (!def->name || !*def->name)
        return bs_fail(cx, BS_EVALUE, "a synthon needs a name");
    if (def->equivalent_count < 1)
        return bs_fail(cx, BS_EVALUE, "equivalents: expected at least one");
    if ((st = bs_new(cx, &rules->arena, 1, out)) != BS_OK)
        return st;
    synthon = *out;
    synthon->def = *def;
    if ((st = bs_book__fold_name(cx, &rules->arena, def->name, &synthon->key)) != BS_OK)
        return st;
    if (find_synthon(rules, synthon->key))
        return bs_fail(cx, BS_EVALUE, "the synthon \"%s\" is there already", def->name);
    if ((st = bs_rules__copy_string(cx, &rules->arena, &synthon->def.name)) != BS_OK ||
        (st = bs_rules__copy_string(cx, &rules->arena, &synthon->def.origin)) != BS_OK ||
        (st = copy_equivalents(cx, &rules->arena, &synthon->def)) != BS_OK)
        return st;
    trial = bs_arena_mark(&rules->arena);
    st = try_synthon(cx, &rules->arena, synthon);
    if (st == BS_ESYNTAX || st == BS_EVALUE) {
        /* The trial blames a side of its cut; the synthon's own field says it better. */
        char *colon = strstr(cx->error.message, "acceptor: ");

        if (colon == cx->error.message)
            memmove(colon, colon + 10, strlen(colon + 10) + 1);
        bs_blame(cx, st, "equivalents");
    }
    bs_arena_rewind(&rules->arena, trial);
    return st;
}

bs_status bs_book__make_room(bs_ctx *cx, bs_rules *rules, void *list, int count, int *room)
{
    int wanted = *room ? *room * 2 : 64;
    void **old;
    void **wide;
    bs_status st;

    if (count < *room)
        return BS_OK;
    if ((st = bs_new(cx, &rules->arena, wanted, &wide)) != BS_OK)
        return st;
    memcpy(&old, list, sizeof old);
    if (count > 0)
        memcpy(wide, old, (size_t)count * sizeof *wide);
    memcpy(list, &wide, sizeof wide);
    *room = wanted;
    return BS_OK;
}

bs_status bs_rules_add_synthon(bs_ctx *cx, bs_rules *rules, const bs_synthon_def *def)
{
    bs_mark temp = bs_arena_mark(&cx->scratch);
    bs_synthon *synthon;
    bs_mark kept;
    bs_status st =
        bs_book__make_room(cx, rules, &rules->synthons, rules->synthon_count, &rules->synthon_room);

    if (st != BS_OK)
        return st;
    kept = bs_arena_mark(&rules->arena);
    if ((st = make_synthon(cx, rules, def, &synthon)) == BS_OK)
        rules->synthons[rules->synthon_count++] = synthon;
    else
        bs_arena_rewind(&rules->arena, kept);
    bs_arena_rewind(&cx->scratch, temp);
    return st;
}

/* ---- Transforms
 * ----------------------------------------------------------------------------------- */

bs_status bs_case__make(bs_ctx *cx, bs_arena *home, const bs_query *target, const bs_query *source,
                        bs_case *out)
{
    bs_status st;

    *out = (bs_case){0};
    if ((st = bs_side__read(cx, home, target, &out->target)) != BS_OK ||
        (st = bs_side__compile(cx, home, &out->target)) != BS_OK)
        return bs_blame(cx, st, "target");
    if ((st = bs_side__read(cx, home, source, &out->source)) != BS_OK ||
        (st = bs_side__compile(cx, home, &out->source)) != BS_OK)
        return bs_blame(cx, st, "from");
    st = bs_reading__make(cx, home, &out->target, &out->source, false, &out->back);
    if (st != BS_OK)
        return bs_blame(cx, st, "from");
    st = bs_reading__make(cx, home, &out->source, &out->target, true, &out->forth);
    if (st != BS_OK)
        return bs_blame(cx, st, "target");
    if ((st = bs_new(cx, home, out->source.part_count + 1, &out->equivalents)) != BS_OK)
        return st;
    for (int i = 0; i < out->source.part_count; i++)
        out->equivalents[i] = 1;
    return bs_reagent__find(cx, home, out);
}

/* Every mapped atom of the precursors has to be one of the target. */
static bs_status check_maps(bs_ctx *cx, const bs_case *kase)
{
    for (int i = 0; i < kase->source.atom_count; i++) {
        int map = kase->source.atoms[i].map;

        if (map > 0 && bs_side__find(&kase->target, map) < 0)
            return bs_fail_at(cx, BS_EVALUE, kase->source.query->atoms[i].offset,
                              "from: map number %d is not in the target", map);
    }
    return BS_OK;
}

static bs_status compile_from(bs_ctx *cx, bs_arena *home, const bs_query *target, bs_transform *tr)
{
    const char *from = tr->def.from;
    bs_query *source;
    bs_status st = bs_query_read(cx, home, from, strlen(from), 0, &source);

    if (st != BS_OK)
        return bs_blame(cx, st, "from");
    if ((st = bs_new(cx, home, 1, &tr->cases)) != BS_OK ||
        (st = bs_case__make(cx, home, target, source, tr->cases)) != BS_OK)
        return st;
    tr->case_count = 1;
    return check_maps(cx, tr->cases);
}

static bs_status named_synthon(bs_ctx *cx, const bs_rules *rules, const char *name,
                               bs_synthon_kind kind, const char *field, const bs_synthon **out)
{
    bs_mark temp = bs_arena_mark(&cx->scratch);
    char *key;
    bs_status st;

    if (!name)
        return bs_fail(cx, BS_EVALUE, "%s: expected the name of a synthon", field);
    if ((st = bs_book__fold_name(cx, &cx->scratch, name, &key)) != BS_OK)
        return st;
    *out = find_synthon(rules, key);
    bs_arena_rewind(&cx->scratch, temp);
    if (!*out)
        return bs_fail(cx, BS_ENOTFOUND, "%s: there is no synthon \"%s\"", field, name);
    if ((*out)->def.kind != kind)
        return bs_fail(cx, BS_EVALUE, "%s: the synthon \"%s\" is a%s", field, name,
                       kind == BS_DONOR ? "n acceptor" : " donor");
    return BS_OK;
}

static bs_status compile_cut(bs_ctx *cx, bs_rules *rules, const bs_query *target, bs_transform *tr)
{
    const bs_synthon *acceptor, *donor;
    bs_status st;

    st = named_synthon(cx, rules, tr->def.acceptor, BS_ACCEPTOR, "acceptor", &acceptor);
    if (st == BS_OK)
        st = named_synthon(cx, rules, tr->def.donor, BS_DONOR, "donor", &donor);
    if (st != BS_OK)
        return st;
    return bs_compose__cut(cx, &rules->arena, target, &tr->def, acceptor, donor, &tr->cases,
                           &tr->case_count);
}

/* The author's map numbers in ascending order. */
static bs_status list_maps(bs_ctx *cx, bs_arena *home, const bs_query *target, bs_transform *tr)
{
    bs_status st;

    if ((st = bs_new(cx, home, target->atom_count + 1, &tr->maps)) != BS_OK ||
        (st = bs_new(cx, home, target->atom_count + 1, &tr->map_atoms)) != BS_OK)
        return st;
    for (int i = 0; i < target->atom_count; i++) {
        int map = target->atoms[i].map, at = tr->map_count;

        if (map == 0)
            continue;
        if (map >= BS_OWN_MAPS)
            return bs_fail_at(cx, BS_EVALUE, target->atoms[i].offset,
                              "target: map numbers go up to %d", BS_OWN_MAPS - 1);
        for (; at > 0 && tr->maps[at - 1] > map; at--) {
            tr->maps[at] = tr->maps[at - 1];
            tr->map_atoms[at] = tr->map_atoms[at - 1];
        }
        tr->maps[at] = map;
        tr->map_atoms[at] = i;
        tr->map_count++;
    }
    return BS_OK;
}

static bs_status compile(bs_ctx *cx, bs_rules *rules, bs_transform *tr)
{
    const char *text = tr->def.target;
    bs_query *target;
    bs_status st;

    if (!text)
        return bs_fail(cx, BS_EVALUE, "target: expected SMARTS");
    if ((tr->def.from != NULL) == (tr->def.cut[0] != 0))
        return bs_fail(cx, BS_EVALUE, "a transform needs either from or cut");
    st = bs_query_read(cx, &rules->arena, text, strlen(text), 0, &target);
    if (st != BS_OK)
        return bs_blame(cx, st, "target");
    if ((st = list_maps(cx, &rules->arena, target, tr)) != BS_OK)
        return st;
    st = tr->def.from ? compile_from(cx, &rules->arena, target, tr)
                      : compile_cut(cx, rules, target, tr);
    if (st != BS_OK)
        return st;
    for (int i = 0; i < tr->case_count; i++) {
        if (tr->cases[i].target.part_count != 1)
            return bs_fail(cx, BS_EVALUE, "target: expected the pattern of one molecule");
    }
    return BS_OK;
}

/* Tells the readings of all cases of the rule's syn or anti addition. */
static bs_status set_addition(bs_ctx *cx, bs_transform *tr)
{
    const bs_transform_def *def = &tr->def;

    for (int i = 0; i < tr->case_count && def->addition != BS_ADDITION_NONE; i++) {
        bs_case *kase = &tr->cases[i];
        int a = bs_side__find(&kase->target, def->addition_maps[0]);
        int b = bs_side__find(&kase->target, def->addition_maps[1]);
        int c = bs_side__find(&kase->source, def->addition_maps[0]);
        int d = bs_side__find(&kase->source, def->addition_maps[1]);

        if (a < 0 || b < 0 || c < 0 || d < 0 || !bs_side__bond(&kase->target, a, b) ||
            !bs_side__bond(&kase->source, c, d))
            return bs_fail(cx, BS_EVALUE, "addition: expected two maps with a bond on both sides");
        /* Of an elimination only the way forwards tells stereo. */
        if (bs_side__bond(&kase->target, a, b)->says.order == 2) {
            kase->forth.addition = (bs_addition){def->addition, c, d, false};
            continue;
        }
        kase->back.addition = (bs_addition){def->addition, a, b, false};
        kase->forth.addition = (bs_addition){def->addition, c, d, true};
    }
    return BS_OK;
}

static bs_status take_names(bs_ctx *cx, bs_rules *rules, bs_transform *tr)
{
    const bs_transform_def *def = &tr->def;
    bs_status st;

    if (!def->name || !*def->name)
        return bs_fail(cx, BS_EVALUE, "a transform needs a name");
    if ((st = bs_new(cx, &rules->arena, def->also.count + 1, &tr->keys)) != BS_OK)
        return st;
    for (int i = 0; i < def->also.count + 1; i++) {
        const char *name = i == 0 ? def->name : def->also.items[i - 1];

        if ((st = bs_book__fold_name(cx, &rules->arena, name, &tr->keys[i])) != BS_OK)
            return st;
        if (find_key(rules, tr->keys[i]) >= 0)
            return bs_fail(cx, BS_EVALUE, "the transform \"%s\" is there already", name);
    }
    tr->key_count = def->also.count + 1;
    return BS_OK;
}

static bs_status make_transform(bs_ctx *cx, bs_rules *rules, const bs_transform_def *def,
                                bs_transform **out)
{
    bs_status st = bs_new(cx, &rules->arena, 1, out);

    if (st != BS_OK)
        return st;
    (*out)->def = *def;
    if ((st = copy_transform(cx, &rules->arena, &(*out)->def)) != BS_OK ||
        (st = take_names(cx, rules, *out)) != BS_OK)
        return st;
    if ((st = compile(cx, rules, *out)) != BS_OK || (st = set_addition(cx, *out)) != BS_OK)
        return st;
    return bs_preference__resolve(cx, rules, *out);
}

bs_status bs_rules_add_transform(bs_ctx *cx, bs_rules *rules, const bs_transform_def *def,
                                 int *index)
{
    bs_mark temp = bs_arena_mark(&cx->scratch);
    bs_transform *transform;
    bs_mark kept;
    bs_status st = bs_book__make_room(cx, rules, &rules->transforms, rules->transform_count,
                                      &rules->transform_room);

    if (st != BS_OK)
        return st;
    kept = bs_arena_mark(&rules->arena);
    if ((st = make_transform(cx, rules, def, &transform)) == BS_OK) {
        if (index)
            *index = rules->transform_count;
        rules->transforms[rules->transform_count++] = transform;
    } else {
        bs_arena_rewind(&rules->arena, kept);
    }
    bs_arena_rewind(&cx->scratch, temp);
    return st;
}
