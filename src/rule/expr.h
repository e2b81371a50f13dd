/*
 * What expressions of atoms and bonds say for certain.
 *
 * A pattern only asks; where a rule makes an atom or a bond, the part of the expression that holds
 * in every case is taken as what is written. "[N;X3;H1,H2;+0]" says nitrogen without charge, and
 * nothing about hydrogens.
 */
#ifndef RULE_EXPR_H
#define RULE_EXPR_H

#include "match/query.h"

enum { BS_UNSAID = -1000 };

typedef struct bs_facts {
    int element;
    int aromatic; /* 0 or 1 */
    int charge;
    int hydrogens; /* all of them */
    int isotope;
    int mark; /* 1: @, 2: @@ */
    int connections;
} bs_facts;

/* Order of a bond of which nothing is written: single, or aromatic between aromatic atoms. */
enum { BS_ORDER_DEFAULT = -2 };

typedef struct bs_bond_facts {
    int order; /* 1 to 4, BS_DRAFT_ORDER_AROMATIC, BS_ORDER_DEFAULT or BS_UNSAID */
    int slope; /* 1: '/', -1: '\', in the direction of the bond; else BS_UNSAID */
    int ring;  /* 1: must be in a ring, 0: must not; else BS_UNSAID */
} bs_bond_facts;

bs_status bs_expr__atom_facts(bs_ctx *cx, const bs_query_expr *expr, bs_facts *out);
bs_status bs_expr__bond_facts(bs_ctx *cx, const bs_query_expr *expr, bs_bond_facts *out);

#endif
