/* The valence model. Valences of uncharged atoms: OpenSMILES, section on the organic subset. */
#include "chem/valence.h"

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
    switch (element) {
    case 5:
        return 13;
    case 6:
    case 14:
    case 32:
    case 50:
        return 14;
    case 7:
    case 15:
    case 33:
    case 51:
        return 15;
    case 8:
    case 16:
    case 34:
    case 52:
        return 16;
    case 9:
    case 17:
    case 35:
    case 53:
    case 85:
        return 17;
    default:
        return 0;
    }
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
    for (const uint8_t *v = bs_valence__normal(element, charge); *v; v++) {
        if (*v >= bonds)
            return *v - bonds;
    }
    return 0;
}

bool bs_valence__is_usual(int element, int charge, int valence)
{
    const uint8_t *v = bs_valence__normal(element, charge);
    int group = group_of(element);

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
