/* Elements and isotopes: symbols, weights, masses. */
#ifndef CHEM_ELEMENT_H
#define CHEM_ELEMENT_H

#include "backsaw/mol.h"

enum { BS_ELEMENT_COUNT = 119 }; /* with the unknown atom */

typedef struct bs_element {
    char symbol[3];
    double weight; /* g/mol; 0 where there is no standard atomic weight */
} bs_element;

typedef struct bs_isotope {
    uint8_t element;
    uint16_t mass_number;
    double mass;      /* u */
    double abundance; /* mole fraction */
} bs_isotope;

extern const bs_element bs_element__table[BS_ELEMENT_COUNT];
extern const bs_isotope bs_isotope__table[];
extern const int bs_isotope__count;

/* Abridged standard atomic weight in g/mol, or 0. */
double bs_element__weight(int element);

/* Mass of the most abundant isotope in u, or 0 for an element without natural isotopes. */
double bs_element__main_mass(int element);

/* Mass of an isotope in u; the mass number itself where the table lacks it. */
double bs_isotope__mass(int element, int mass_number);

#endif
