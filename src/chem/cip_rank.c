/*
 * Ranking the ligands of a node of the digraph by the sequence rules.
 *
 * A rule sorts the neighbours of all nodes, the farthest nodes first; two neighbours are compared
 * sphere by sphere, and within a sphere set by set in the order that the ranking so far gives. It
 * only touches neighbours that the rules before have left tied.
 */
#include "chem/cip.h"

#include <string.h>

static bs_status check_work(bs_cip *cip)
{
    if (cip->work_left < 0)
        return bs_fail(cip->cx, BS_ELIMIT, "the molecule is too large for CIP labels");
    return bs_poll(cip->cx);
}

/* ---- Views ------------------------------------------------------------------------------------ */

/* Lists the tree from `root` outwards. Returns the number of nodes. */
static uint32_t look_from(bs_cip *cip, uint32_t root)
{
    uint32_t count = 1, kids = 0;
    uint32_t *from = cip->queue; /* by node: the neighbour that leads back */

    cip->order[0] = root;
    from[root] = BS_CIP_NONE;
    for (uint32_t i = 0; i < count; i++) {
        uint32_t at = cip->order[i];
        bs_cip_node *node = &cip->nodes[at];

        node->kids_at = kids;
        if (node->parent != BS_CIP_NONE && node->parent != from[at])
            cip->kids[kids++] = node->parent;
        for (uint32_t k = 0; k < node->count; k++)
            if (node->first + k != from[at])
                cip->kids[kids++] = node->first + k;
        node->kid_count = kids - node->kids_at;
        for (uint32_t k = node->kids_at; k < kids; k++) {
            cip->split[k] = BS_CIP_TIED;
            from[cip->kids[k]] = at;
            cip->order[count++] = cip->kids[k];
        }
    }
    cip->work_left -= count;
    return count;
}

/* ---- Comparing -------------------------------------------------------------------------------- */

static int likeness(const bs_cip *cip, int label)
{
    bool r = label == BS_CIP_R || label == BS_CIP_CIS;
    bool s = label == BS_CIP_S || label == BS_CIP_TRANS;

    return cip->reference == BS_CIP_R ? r : s;
}

static int key(const bs_cip *cip, uint32_t at, bs_cip_rule rule)
{
    /* Rules 3, 4a and 4c by label: none, R, S, r, s, Z, E, cis, trans. */
    static const uint8_t geometry[] = {0, 0, 0, 0, 0, 2, 1, 0, 0};
    static const uint8_t class[] = {0, 2, 2, 1, 1, 1, 1, 2, 2};
    static const uint8_t small[] = {0, 0, 0, 2, 1, 0, 0, 0, 0};
    const bs_cip_node *node = &cip->nodes[at];

    switch (rule) {
    case BS_CIP_1A:
        return node->number;
    case BS_CIP_1B:
        return -(int)node->distance;
    case BS_CIP_2:
        return (int)node->mass;
    case BS_CIP_3:
        return geometry[node->aux];
    case BS_CIP_4A:
        return class[node->aux];
    case BS_CIP_4C:
        return small[node->aux];
    case BS_CIP_6:
        return node->atom == cip->reference;
    case BS_CIP_LIKE:
        return likeness(cip, node->aux);
    case BS_CIP_TIED:
    case BS_CIP_4B:
    case BS_CIP_5:
        break;
    }
    return 0;
}

/* Compares two sets of neighbours; what is missing comes last. */
static int compare_sets(bs_cip *cip, const bs_cip_node *a, const bs_cip_node *b, bs_cip_rule rule)
{
    uint32_t common = a->kid_count < b->kid_count ? a->kid_count : b->kid_count;

    for (uint32_t k = 0; k < common; k++) {
        int x = key(cip, cip->kids[a->kids_at + k], rule);
        int y = key(cip, cip->kids[b->kids_at + k], rule);

        if (x != y)
            return x > y ? 1 : -1;
    }
    cip->work_left -= common + 1;
    if (a->kid_count != b->kid_count)
        return a->kid_count > b->kid_count ? 1 : -1;
    return 0;
}

/* Above 0 if the branch at x ranks above that at y by the rule. */
static int compare(bs_cip *cip, uint32_t x, uint32_t y, bs_cip_rule rule)
{
    uint32_t head = 0, tail = 0;
    int first = key(cip, x, rule), second = key(cip, y, rule);

    if (first != second)
        return first > second ? 1 : -1;
    cip->queue[tail++] = x;
    cip->queue[tail++] = y;
    while (head < tail && cip->work_left >= 0) {
        const bs_cip_node *a = &cip->nodes[cip->queue[head++]];
        const bs_cip_node *b = &cip->nodes[cip->queue[head++]];
        int sign = compare_sets(cip, a, b, rule);

        if (sign)
            return sign;
        for (uint32_t k = 0; k < a->kid_count; k++) {
            cip->queue[tail++] = cip->kids[a->kids_at + k];
            cip->queue[tail++] = cip->kids[b->kids_at + k];
        }
    }
    return 0;
}

/* Sorts a run of tied neighbours by insertion and marks where they part. */
static void sort_run(bs_cip *cip, uint32_t start, uint32_t end, bs_cip_rule rule)
{
    uint32_t *kids = cip->kids;

    for (uint32_t i = start + 1; i < end; i++) {
        uint32_t moving = kids[i];
        uint32_t k = i;

        for (; k > start && compare(cip, kids[k - 1], moving, rule) < 0; k--)
            kids[k] = kids[k - 1];
        kids[k] = moving;
    }
    for (uint32_t i = start + 1; i < end; i++)
        if (compare(cip, kids[i - 1], kids[i], rule) != 0)
            cip->split[i] = (uint8_t)rule;
}

static void refine_node(bs_cip *cip, uint32_t at, bs_cip_rule rule)
{
    uint32_t end = cip->nodes[at].kids_at + cip->nodes[at].kid_count;
    uint32_t start = cip->nodes[at].kids_at;

    while (start < end) {
        uint32_t next = start + 1;

        while (next < end && cip->split[next] == BS_CIP_TIED)
            next++;
        if (next - start > 1)
            sort_run(cip, start, next, rule);
        start = next;
    }
}

bs_status bs_cip__refine(bs_cip *cip, bs_cip_rule rule)
{
    for (uint32_t i = cip->count; i-- > 0 && cip->work_left >= 0;)
        refine_node(cip, cip->order[i], rule);
    return check_work(cip);
}

/* ---- Ligands ---------------------------------------------------------------------------------- */

/* Reads the ranking of the view's root: duplicates for bonds are no ligands, nor is `skip`. */
static void read_ranking(const bs_cip *cip, uint32_t skip, bs_cip_ranking *out)
{
    const bs_cip_node *root = &cip->nodes[cip->order[0]];
    int rule = BS_CIP_TIED; /* the first rule that parts this ligand from the one before */

    memset(out, 0, sizeof *out);
    out->distinct = true;
    for (uint32_t k = root->kids_at; k < root->kids_at + root->kid_count; k++) {
        uint32_t kid = cip->kids[k];

        if (k > root->kids_at && cip->split[k] && (!rule || cip->split[k] < rule))
            rule = cip->split[k];
        if (kid == skip || cip->nodes[kid].kind == BS_CIP_BOND_DUPLICATE)
            continue;
        if (out->count == BS_CIP_LEGS) {
            out->distinct = false;
            return;
        }
        if (out->count > 0) {
            out->distinct = out->distinct && rule != BS_CIP_TIED;
            out->mirrored ^= rule == BS_CIP_5;
        }
        out->legs[out->count++] = kid;
        rule = BS_CIP_TIED;
    }
}

/* The child of the root that stands for an atom, or BS_CIP_NONE. */
static uint32_t child_of_root(const bs_cip *cip, uint32_t atom)
{
    for (uint32_t k = 0; k < cip->nodes[0].count && atom != BS_CIP_NONE; k++) {
        const bs_cip_node *child = &cip->nodes[cip->nodes[0].first + k];

        if (child->kind == BS_CIP_REAL && child->atom == atom)
            return cip->nodes[0].first + k;
    }
    return BS_CIP_NONE;
}

bs_status bs_cip__rank_lazily(bs_cip *cip, uint32_t skip, bs_cip_ranking *out)
{
    bool complete = false;
    bs_status st;

    for (uint32_t depth = 1; !complete; depth += 1 + depth / 8) {
        if ((st = bs_cip__grow(cip, depth, &complete)) != BS_OK)
            return st;
        look_from(cip, 0);
        if ((st = bs_cip__refine(cip, BS_CIP_1A)) != BS_OK)
            return st;
        read_ranking(cip, child_of_root(cip, skip), out);
        if (out->distinct)
            return BS_OK;
    }
    for (bs_cip_rule rule = BS_CIP_1B; rule <= BS_CIP_2 && !out->distinct; rule++) {
        if ((st = bs_cip__refine(cip, rule)) != BS_OK)
            return st;
        read_ranking(cip, child_of_root(cip, skip), out);
    }
    return BS_OK;
}

/*
 * Rule 6: where ligands are alike by an axis of rotation, any one of them is made the best; all
 * choices give one label.
 */
static bs_status prefer_one(bs_cip *cip, uint32_t skip, bs_cip_ranking *out)
{
    const bs_cip_node *root = &cip->nodes[cip->order[0]];
    uint32_t k = root->kids_at + 1;
    bs_status st;

    while (k < root->kids_at + root->kid_count && cip->split[k])
        k++;
    if (k >= root->kids_at + root->kid_count)
        return BS_OK;
    cip->reference = cip->nodes[cip->kids[k]].atom;
    if (cip->reference == BS_DRAFT_HYDROGEN)
        return BS_OK;
    if ((st = bs_cip__refine(cip, BS_CIP_6)) == BS_OK)
        read_ranking(cip, skip, out);
    return st;
}

bs_status bs_cip__rank(bs_cip *cip, uint32_t node, uint32_t skip, bs_cip_ranking *out)
{
    bs_status st = BS_OK;

    look_from(cip, node);
    for (bs_cip_rule rule = BS_CIP_1A; rule <= BS_CIP_5; rule++) {
        if (rule == BS_CIP_4B || rule == BS_CIP_5)
            st = bs_cip__pair(cip, rule);
        else
            st = bs_cip__refine(cip, rule);
        if (st != BS_OK)
            return st;
        read_ranking(cip, skip, out);
        if (out->distinct)
            return BS_OK;
    }
    return node == 0 ? prefer_one(cip, skip, out) : BS_OK;
}
