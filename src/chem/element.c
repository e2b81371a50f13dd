/* Looking up elements and isotopes. */
#include "chem/element.h"

#include <string.h>

const char *bs_element_symbol(int atomic_number)
{
    if (atomic_number < 0 || atomic_number >= BS_ELEMENT_COUNT)
        return NULL;
    return bs_element__table[atomic_number].symbol;
}

int bs_element_number(const char *symbol, size_t length)
{
    if (length < 1 || length > 2)
        return -1;
    for (int z = 0; z < BS_ELEMENT_COUNT; z++) {
        const char *known = bs_element__table[z].symbol;

        if (known[0] == symbol[0] && known[1] == (length == 2 ? symbol[1] : '\0'))
            return z;
    }
    return -1;
}

double bs_element__weight(int element)
{
    return bs_element__table[element].weight;
}

/* The first isotope of an element in the table, or the end of the table. */
static const bs_isotope *first_isotope(int element)
{
    int low = 0;
    int high = bs_isotope__count;

    while (low < high) {
        int middle = (low + high) / 2;

        if (bs_isotope__table[middle].element < element)
            low = middle + 1;
        else
            high = middle;
    }
    return bs_isotope__table + low;
}

double bs_element__main_mass(int element)
{
    const bs_isotope *end = bs_isotope__table + bs_isotope__count;
    double best = 0;
    double mass = 0;

    for (const bs_isotope *i = first_isotope(element); i < end && i->element == element; i++) {
        if (i->abundance > best) {
            best = i->abundance;
            mass = i->mass;
        }
    }
    return mass;
}

double bs_isotope__mass(int element, int mass_number)
{
    const bs_isotope *end = bs_isotope__table + bs_isotope__count;

    for (const bs_isotope *i = first_isotope(element); i < end && i->element == element; i++) {
        if (i->mass_number == mass_number)
            return i->mass;
    }
    return mass_number;
}
