/*
 * Rules 4b and 5: comparing ligands by the sequence of their descriptors.
 *
 * Under rule 4b the descriptors of a ligand are read sphere by sphere as like or unlike its
 * reference descriptor, the one that is met first, or the more frequent of those met first
 * together; where both are as frequent, both are tried and the better reading counts. Under rule 5
 * the reference is R. Nodes that are tied by the rules before are read like before unlike.
 */
#include "chem/cip.h"

#include <string.h>

/* The reading of a leg: a byte for each descriptor, 1 for like. */
typedef struct reading {
    uint8_t *text;
    uint32_t length;
} reading;

typedef struct pairing {
    bs_cip *cip;
    reading r[BS_CIP_LEGS], s[BS_CIP_LEGS]; /* by place of the leg, reference R or S */
    uint8_t refs[BS_CIP_LEGS];              /* 1: R, 2: S, 3: both */
    uint32_t *node, *next_node;             /* two levels of the search for the reference */
    uint8_t *ends, *next_ends;              /* whether a node is the last of its group */
} pairing;

static int hand_of(const bs_cip_node *node)
{
    if (node->aux == BS_CIP_R || node->aux == BS_CIP_CIS)
        return 1;
    return node->aux == BS_CIP_S || node->aux == BS_CIP_TRANS ? 2 : 0;
}

/* ---- References ------------------------------------------------------------------------------- */

/* Adds the neighbours of class `class` of one node to the next level; false if it has none. */
static bool add_class(pairing *p, uint32_t at, int class, uint32_t *count)
{
    const bs_cip_node *node = &p->cip->nodes[at];
    bool found = false;
    int seen = 0;

    for (uint32_t k = node->kids_at; k < node->kids_at + node->kid_count; k++) {
        seen += k > node->kids_at && p->cip->split[k];
        if (seen != class)
            continue;
        p->next_node[*count] = p->cip->kids[k];
        p->next_ends[(*count)++] = 0;
        found = true;
    }
    return found;
}

/* Makes the next level: groups of nodes that the ranking does not tell apart, best first. */
static uint32_t next_level(pairing *p, uint32_t count)
{
    uint32_t made = 0;

    for (uint32_t start = 0, end; start < count; start = end) {
        bool found = true;

        for (end = start; !p->ends[end]; end++)
            continue;
        end++;
        for (int class = 0; found; class++) {
            found = false;
            for (uint32_t i = start; i < end; i++)
                found |= add_class(p, p->node[i], class, &made);
            if (found)
                p->next_ends[made - 1] = 1;
        }
    }
    return made;
}

/* The references of a leg: 1 for R, 2 for S, 3 for both, 0 if it has no descriptor. */
static uint8_t find_references(pairing *p, uint32_t leg)
{
    uint32_t count = 1;

    p->node[0] = leg;
    p->ends[0] = 1;
    while (count > 0 && p->cip->work_left >= 0) {
        uint32_t tally[3] = {0};
        uint32_t *nodes = p->node;
        uint8_t *ends = p->ends;

        for (uint32_t i = 0; i < count; i++) {
            tally[hand_of(&p->cip->nodes[p->node[i]])]++;
            if (!p->ends[i])
                continue;
            if (tally[1] != tally[2])
                return tally[1] > tally[2] ? 1 : 2;
            if (tally[1] > 0)
                return 3;
        }
        p->cip->work_left -= count;
        count = next_level(p, count);
        p->node = p->next_node;
        p->next_node = nodes;
        p->ends = p->next_ends;
        p->next_ends = ends;
    }
    return 0;
}

/* ---- Readings --------------------------------------------------------------------------------- */

static void read_leg(bs_cip *cip, uint32_t leg, int reference, reading *out)
{
    uint32_t head = 0, tail = 0;

    out->length = 0;
    cip->queue[tail++] = leg;
    while (head < tail) {
        const bs_cip_node *node = &cip->nodes[cip->queue[head++]];
        int hand = hand_of(node);

        if (hand)
            out->text[out->length++] = hand == reference;
        for (uint32_t k = 0; k < node->kid_count; k++)
            cip->queue[tail++] = cip->kids[node->kids_at + k];
    }
    cip->work_left -= tail;
}

/* Reads all legs with one reference: sorts the view by likeness, reads, and puts it back. */
static bs_status read_all(bs_cip *cip, int reference, reading *out)
{
    const bs_cip_node *root = &cip->nodes[cip->order[0]];
    bs_status st;

    memcpy(cip->kept_kids, cip->kids, cip->count * sizeof *cip->kids);
    memcpy(cip->kept_split, cip->split, cip->count);
    cip->reference = reference == 1 ? BS_CIP_R : BS_CIP_S;
    st = bs_cip__refine(cip, BS_CIP_LIKE);
    for (uint32_t k = 0; k < root->kid_count && st == BS_OK; k++)
        read_leg(cip, cip->kept_kids[root->kids_at + k], reference, &out[k]);
    memcpy(cip->kids, cip->kept_kids, cip->count * sizeof *cip->kids);
    memcpy(cip->split, cip->kept_split, cip->count);
    return st;
}

static int compare_readings(const reading *a, const reading *b)
{
    uint32_t common = a->length < b->length ? a->length : b->length;
    int sign = common ? memcmp(a->text, b->text, common) : 0;

    if (sign == 0 && a->length != b->length)
        return a->length > b->length ? 1 : -1;
    return sign;
}

/* The better (0) or the other (1) of the readings of a leg. */
static const reading *pick(const pairing *p, uint32_t leg, int place)
{
    const reading *r = &p->r[leg], *s = &p->s[leg];

    if (p->refs[leg] == 3)
        return (compare_readings(r, s) >= 0) == (place == 0) ? r : s;
    return p->refs[leg] == 2 ? s : r;
}

static int compare_legs(const pairing *p, uint32_t x, uint32_t y, bs_cip_rule rule)
{
    int sign;

    if (rule == BS_CIP_5)
        return compare_readings(&p->r[x], &p->r[y]);
    sign = compare_readings(pick(p, x, 0), pick(p, y, 0));
    return sign ? sign : compare_readings(pick(p, x, 1), pick(p, y, 1));
}

/* ---- Sorting ---------------------------------------------------------------------------------- */

/* Sorts each run of tied legs. `place` follows the legs, as the readings do not move. */
static void sort_legs(pairing *p, const bs_cip_node *root, bs_cip_rule rule)
{
    uint32_t *kids = p->cip->kids + root->kids_at;
    uint8_t *split = p->cip->split + root->kids_at;
    uint32_t place[BS_CIP_LEGS];

    for (uint32_t i = 0; i < root->kid_count; i++) {
        uint32_t moving = kids[i], k = i;

        for (; k > 0 && !split[k] && compare_legs(p, place[k - 1], i, rule) < 0; k--) {
            kids[k] = kids[k - 1];
            place[k] = place[k - 1];
        }
        kids[k] = moving;
        place[k] = i;
    }
    for (uint32_t i = 1; i < root->kid_count; i++)
        if (!split[i] && compare_legs(p, place[i - 1], place[i], rule) != 0)
            split[i] = (uint8_t)rule;
}

/* Memory for the readings and the levels. */
static bs_status prepare(pairing *p, const bs_cip_node *root)
{
    bs_ctx *cx = p->cip->cx;
    uint32_t count = p->cip->count;
    bs_status st;

    if ((st = bs_new(cx, &cx->scratch, count, &p->node)) != BS_OK ||
        (st = bs_new(cx, &cx->scratch, count, &p->next_node)) != BS_OK ||
        (st = bs_new(cx, &cx->scratch, count, &p->ends)) != BS_OK ||
        (st = bs_new(cx, &cx->scratch, count, &p->next_ends)) != BS_OK)
        return st;
    for (uint32_t k = 0; k < root->kid_count; k++) {
        if ((st = bs_new(cx, &cx->scratch, count, &p->r[k].text)) != BS_OK ||
            (st = bs_new(cx, &cx->scratch, count, &p->s[k].text)) != BS_OK)
            return st;
    }
    return BS_OK;
}

bs_status bs_cip__pair(bs_cip *cip, bs_cip_rule rule)
{
    const bs_cip_node *root = &cip->nodes[cip->order[0]];
    bs_mark temp = bs_arena_mark(&cip->cx->scratch);
    pairing p = {.cip = cip};
    bool any = false;
    bs_status st = BS_OK;

    for (uint32_t i = 1; i < cip->count; i++)
        any |= hand_of(&cip->nodes[cip->order[i]]) != 0;
    if (!any || root->kid_count > BS_CIP_LEGS)
        return BS_OK;
    if ((st = prepare(&p, root)) != BS_OK || (st = read_all(cip, 1, p.r)) != BS_OK)
        goto done;
    if (rule == BS_CIP_4B) {
        if ((st = read_all(cip, 2, p.s)) != BS_OK)
            goto done;
        for (uint32_t k = 0; k < root->kid_count; k++)
            p.refs[k] = find_references(&p, cip->kids[root->kids_at + k]);
    }
    sort_legs(&p, root, rule);
done:
    bs_arena_rewind(&cip->cx->scratch, temp);
    return st;
}
