/* The valence model. Valences of uncharged atoms: OpenSMILES, section on the organic subset. */
#include "chem/valence.h"

#include <stddef.h>

static const uint8_t none[] = {0};
static const uint8_t one[] = {1, 0};
static const uint8_t two[] = {2, 0};
static const uint8_t three[] = {3, 0};
static const uint8_t four[] = {4, 0};
static const uint8_t three_five[] = {3, 5, 0};
static const uint8_t two_four_six[] = {2, 4, 6, 0};

/* The group of a main-group element that has normal valences, else 0. */
static int group_of(int element)
{
    static const uint8_t groups[] = {
        [5] = 13,  [6] = 14,  [7] = 15,  [8] = 16,  [9] = 17,  [14] = 14,
        [15] = 15, [16] = 16, [17] = 17, [32] = 14, [33] = 15, [34] = 16,
        [35] = 17, [50] = 14, [51] = 15, [52] = 16, [53] = 17, [85] = 17,
    };

    return element >= 0 && (size_t)element < sizeof groups ? groups[element] : 0;
}

/* Elements of the second row do not expand their octet, save nitrogen as written without charge. */
static bool expands(int element, int charge)
{
    return element > 10 || (element == 7 && charge == 0);
}

const uint8_t *bs_valence__normal(int element, int charge)
{
    int group = group_of(element);

    if (element == 1)
        return charge == 0 ? one : none;
    if (group == 0)
        return none;
    switch (group - charge) {
    case 13:
        return three;
    case 14:
        return four;
    case 15:
        return expands(element, charge) ? three_five : three;
    case 16:
        return expands(element, charge) ? two_four_six : two;
    case 17:
        return one;
    case 12:
        return two;
    case 11:
        return one;
    default:
        return none;
    }
}

int bs_valence__implied(int element, int charge, int bonds)
{
    if (element == 6 && charge == 0)
        return bonds < 4 ? 4 - bonds : 0;
    for (const uint8_t *v = bs_valence__normal(element, charge); *v; v++) {
        if (*v >= bonds)
            return *v - bonds;
    }
    return 0;
}

bool bs_valence__is_usual(int element, int charge, int valence)
{
    const uint8_t *v;
    int group = group_of(element);

    if (element == 6 && charge == 0)
        return valence == 4;
    v = bs_valence__normal(element, charge);
    if (group == 0 && element != 1)
        return true;
    if (element == 7 && charge == 0 && valence == 5)
        return false;
    /* Halogens bound to oxygen, and hypervalent iodine. */
    if (group == 17 && element > 9 && charge == 0 && (valence == 3 || valence == 5 || valence == 7))
        return true;
    if (group == 17 && element > 9 && charge == 1 && valence == 2)
        return true;
    if (*v == 0)
        return valence == 0;
    for (; *v; v++) {
        if (*v == valence)
            return true;
    }
    /* Anions that complete the shell of a heavier atom: PF6-, SiF6 2-, and the like. */
    return element > 10 && charge < 0 && valence + charge >= 0 && valence <= 6;
}
