/* The shelf: catalogues and lists in order of preference. */
#include "catalogue/store.h"

#include "backsaw/format.h"
#include "core/map.h"

#include <math.h>
#include <string.h>

/* What an offer without price counts as, as in a list that states none. */
#define UNPRICED_PER_MOLE 1.0

/* The list of what is always at hand; the others are numbered from 0. */
#define AT_HAND (-1)

typedef struct entry {
    const char *smiles; /* canonical */
    double per_mole;
    int list;
} entry;

typedef struct source {
    bs_catalogue *catalogue; /* NULL for a list */
    int list;
} source;

/* `map` goes from list and canonical SMILES to entries; the strings lie in `home`. */
struct bs_shelf {
    bs_gate *gate;
    bs_arena home;
    bs_map map;
    entry *entries;
    size_t entry_count, entry_room;
    source *sources;
    size_t source_count, source_room;
    int list_count;
};

bs_status bs_shelf_new(bs_ctx *cx, bs_shelf **out)
{
    bs_shelf *shelf = bs_gate_alloc(cx->gate, sizeof *shelf);

    *out = shelf;
    if (!shelf)
        return bs_fail_memory(cx);
    shelf->gate = cx->gate;
    bs_arena_init(&shelf->home, cx->gate);
    bs_map_init(&shelf->map, cx);
    return BS_OK;
}

void bs_shelf_free(bs_shelf *shelf)
{
    if (!shelf)
        return;
    bs_map_free(&shelf->map);
    bs_gate_free(shelf->gate, shelf->entries, shelf->entry_room * sizeof *shelf->entries);
    bs_gate_free(shelf->gate, shelf->sources, shelf->source_room * sizeof *shelf->sources);
    bs_arena_free(&shelf->home);
    bs_gate_free(shelf->gate, shelf, sizeof *shelf);
}

/* Room for one more element of `size` bytes; returns the array, or NULL. */
static void *grow(bs_shelf *shelf, void *array, size_t count, size_t *room, size_t size)
{
    size_t wanted = *room ? *room * 2 : 16;
    void *moved;

    if (count < *room)
        return array;
    moved = bs_gate_resize(shelf->gate, array, *room * size, wanted * size);
    if (moved)
        *room = wanted;
    return moved;
}

/* ---- Sources --------------------------------------------------------------------------- */

static bs_status add_source(bs_ctx *cx, bs_shelf *shelf, source added)
{
    source *sources = grow(shelf, shelf->sources, shelf->source_count, &shelf->source_room,
                           sizeof *shelf->sources);

    if (!sources)
        return bs_fail_memory(cx);
    shelf->sources = sources;
    shelf->sources[shelf->source_count++] = added;
    return BS_OK;
}

bs_status bs_shelf_add_catalogue(bs_ctx *cx, bs_shelf *shelf, bs_catalogue *catalogue)
{
    return add_source(cx, shelf, (source){.catalogue = catalogue});
}

bs_status bs_shelf_add_list(bs_ctx *cx, bs_shelf *shelf, int *list)
{
    bs_status st = add_source(cx, shelf, (source){.list = shelf->list_count});

    if (st == BS_OK)
        *list = shelf->list_count++;
    return st;
}

bool bs_shelf_is_listed(const bs_shelf *shelf)
{
    for (size_t i = 0; i < shelf->source_count; i++) {
        if (shelf->sources[i].catalogue)
            return false;
    }
    return true;
}

const char *bs_shelf_listed(const bs_shelf *shelf, size_t at)
{
    return at < shelf->entry_count ? shelf->entries[at].smiles : NULL;
}

/* ---- Entries --------------------------------------------------------------------------- */

static uint64_t key_of(int list, const char *smiles)
{
    return bs_hash_bytes(smiles, strlen(smiles), (uint64_t)list + 1);
}

static entry *find_entry(bs_shelf *shelf, int list, const char *smiles)
{
    uint64_t key = key_of(list, smiles);
    size_t cursor = 0;
    uint32_t at;

    while ((at = bs_map_next(&shelf->map, key, &cursor)) != BS_MAP_NONE) {
        entry *e = &shelf->entries[at];

        if (e->list == list && strcmp(e->smiles, smiles) == 0)
            return e;
    }
    return NULL;
}

static bs_status add_entry(bs_ctx *cx, bs_shelf *shelf, int list, const char *smiles,
                           double per_mole)
{
    entry *entries = grow(shelf, shelf->entries, shelf->entry_count, &shelf->entry_room,
                          sizeof *shelf->entries);
    bs_mark kept = bs_arena_mark(&shelf->home);
    char *copy;
    bs_status st;

    if (!entries)
        return bs_fail_memory(cx);
    shelf->entries = entries;
    if (shelf->entry_count >= BS_MAP_NONE - 1)
        return bs_fail(cx, BS_ELIMIT, "a shelf holds at most 4294967294 compounds");
    if ((st = bs_copy_text(cx, &shelf->home, smiles, strlen(smiles), &copy)) != BS_OK)
        return st;
    shelf->map.cx = cx;
    st = bs_map_add(&shelf->map, key_of(list, smiles), (uint32_t)shelf->entry_count);
    if (st != BS_OK) {
        bs_arena_rewind(&shelf->home, kept);
        return st;
    }
    entries[shelf->entry_count++] = (entry){copy, per_mole, list};
    return BS_OK;
}

static bs_status put(bs_ctx *cx, bs_shelf *shelf, int list, const bs_mol *mol, double per_mole)
{
    bs_mark temp = bs_arena_mark(&cx->scratch);
    char *smiles;
    entry *e;
    bs_status st = bs_smiles_canonical(cx, &cx->scratch, mol, 0, &smiles);

    if (st != BS_OK)
        goto done;
    e = find_entry(shelf, list, smiles);
    if (!e)
        st = add_entry(cx, shelf, list, smiles, per_mole);
    else if (per_mole < e->per_mole)
        e->per_mole = per_mole;
done:
    bs_arena_rewind(&cx->scratch, temp);
    return st;
}

bs_status bs_shelf_put(bs_ctx *cx, bs_shelf *shelf, int list, const bs_mol *mol, double per_mole)
{
    if (list < 0 || list >= shelf->list_count)
        return bs_fail(cx, BS_ERANGE, "the shelf has no list number %d", list);
    if (!(per_mole >= 0) || !isfinite(per_mole))
        return bs_fail(cx, BS_ERANGE, "a price per mole must be a number of 0 or more, not %g",
                       per_mole);
    return put(cx, shelf, list, mol, per_mole);
}

bs_status bs_shelf_at_hand(bs_ctx *cx, bs_shelf *shelf, const bs_mol *mol)
{
    return put(cx, shelf, AT_HAND, mol, 0);
}

/* ---- Prices ---------------------------------------------------------------------------- */

/* Known atoms, and no carbon among them: water, ammonia, mineral acids, their salts. */
static bool is_inorganic(const bs_mol *mol)
{
    for (int i = 0; i < bs_mol_atom_count(mol); i++) {
        int element = bs_mol_atom_element(mol, i);

        if (element == 0 || element == 6)
            return false;
    }
    return bs_mol_atom_count(mol) > 0;
}

/* The price of the cheapest offer of a catalogue; -1 if the offer has none. */
static bs_status ask_catalogue(bs_ctx *cx, bs_arena *home, bs_catalogue *catalogue,
                               const bs_mol *mol, const char *smiles, bool *found,
                               double *per_mole, bs_offer *offer)
{
    bs_offers offers;
    double mass;
    bs_status st = bs_store__find(cx, home, catalogue, smiles, 1, &offers);

    if (st != BS_OK || offers.count == 0)
        return st;
    *offer = offers.items[0];
    *per_mole = -1;
    if (offer->price_per_gram >= 0) {
        if ((st = bs_mol_mass(cx, mol, &mass)) != BS_OK)
            return st;
        *per_mole = offer->price_per_gram * mass;
    }
    *found = true;
    return BS_OK;
}

bs_status bs_shelf_price(bs_ctx *cx, bs_arena *home, bs_shelf *shelf, const bs_mol *mol,
                         const char *smiles, bool *found, double *per_mole, bs_offer *offer)
{
    bs_mark kept = bs_arena_mark(home), temp = bs_arena_mark(&cx->scratch);
    bs_offer first = {.price_per_gram = -1, .container_g = -1, .lead_days = -1};
    bool free_of_charge = is_inorganic(mol) || find_entry(shelf, AT_HAND, smiles);
    bs_status st = BS_OK;

    *found = false;
    *per_mole = -1;
    for (size_t i = 0; i < shelf->source_count && !*found && st == BS_OK; i++) {
        const source *s = &shelf->sources[i];
        entry *e;

        if (s->catalogue) {
            st = ask_catalogue(cx, offer ? home : &cx->scratch, s->catalogue, mol, smiles, found,
                               per_mole, &first);
        } else if ((e = find_entry(shelf, s->list, smiles))) {
            *found = true;
            *per_mole = e->per_mole;
        }
    }
    if (free_of_charge || *found)
        *per_mole = *per_mole >= 0 ? *per_mole : free_of_charge ? 0 : UNPRICED_PER_MOLE;
    *found |= free_of_charge;
    if (st != BS_OK) {
        *found = false;
        first = (bs_offer){0};
        bs_arena_rewind(home, kept);
    }
    if (!offer || home != &cx->scratch)
        bs_arena_rewind(&cx->scratch, temp);
    if (offer)
        *offer = first;
    return st;
}
