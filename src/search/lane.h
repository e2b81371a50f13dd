/*
 * Expanding a batch by several threads.
 *
 * A job's lane follows from its place in the batch, and each lane works through its jobs in order
 * with a context of its own, so that what a job gives does not depend on the number of threads.
 * A thread takes one lane after the other.
 */
#ifndef SEARCH_LANE_H
#define SEARCH_LANE_H

#include "search/explore.h"

typedef struct bs_lane_job {
    const char *smiles;
    bool closed;
    int lane;
    bool ran;
    bs_status status;
    bs_error error; /* if status is not BS_OK */
    bs_arena home;  /* of `found` */
    bs_proposals found;
} bs_lane_job;

/* Runs one job on the context given. */
void bs_lane__run(const bs_explore *x, bs_ctx *cx, bs_lane_job *job);

/*
 * Runs all jobs with x->limits.threads threads.
 *
 *   errors  BS_ENOMEM. What a job failed with stands in the job.
 */
bs_status bs_lane__run_all(const bs_explore *x, bs_lane_job *jobs, int count);

#endif
