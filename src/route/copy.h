/* Deep copies of the parts of a route; all strings move to `home`. */
#ifndef ROUTE_COPY_H
#define ROUTE_COPY_H

#include "backsaw/route.h"

bs_status bs_route__copy_molecule(bs_ctx *cx, bs_arena *home, const bs_route_molecule *from,
                                  bs_route_molecule *to);
bs_status bs_route__copy_step(bs_ctx *cx, bs_arena *home, const bs_route_step *from,
                              bs_route_step *to);

/* A copy of a string with a NUL; NULL stays NULL. */
bs_status bs_route__copy_string(bs_ctx *cx, bs_arena *home, const char *from, const char **to);

#endif
