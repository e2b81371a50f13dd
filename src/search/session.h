/* The kept search behind search.h. */
#ifndef SEARCH_SESSION_H
#define SEARCH_SESSION_H

#include "search/plan.h"

struct bs_search {
    bs_plan_state plan;
};

#endif
