/* Worker lanes for expansion. */
#include "search/lane.h"

#include <pthread.h>

/* What the threads share: the jobs, and the next lane that nobody has taken. */
typedef struct crew {
    const bs_explore *x;
    bs_lane_job *jobs;
    bs_ctx *contexts; /* one a lane */
    int count;
    int lane_count;
    _Atomic int next;
} crew;

void bs_lane__run(const bs_explore *x, bs_ctx *cx, bs_lane_job *job)
{
    job->ran = true;
    job->status = x->calls.expand(x->calls.payload, cx, &job->home, job->lane, job->smiles,
                                  job->closed, &job->found);
    if (job->status != BS_OK)
        job->error = cx->error;
}

static void *work(void *argument)
{
    crew *c = argument;
    int lane;

    while ((lane = atomic_fetch_add(&c->next, 1)) < c->lane_count) {
        for (int i = 0; i < c->count; i++) {
            if (c->jobs[i].lane == lane && !atomic_load(c->x->cx->stop))
                bs_lane__run(c->x, &c->contexts[lane], &c->jobs[i]);
        }
    }
    return NULL;
}

/* Starts the helpers, works along, and waits; with fewer threads than wished it only takes longer. */
static void run_crew(crew *c, pthread_t *threads, int wanted)
{
    int started = 0;

    while (started < wanted && pthread_create(&threads[started], NULL, work, c) == 0)
        started++;
    work(c);
    for (int i = 0; i < started; i++)
        pthread_join(threads[i], NULL);
}

bs_status bs_lane__run_all(const bs_explore *x, bs_lane_job *jobs, int count)
{
    bs_ctx *cx = x->cx;
    bs_mark temp = bs_arena_mark(&cx->scratch);
    crew c = {.x = x, .jobs = jobs, .count = count, .lane_count = x->limits.lanes};
    int helpers = x->limits.threads - 1;
    pthread_t *threads = NULL;
    bs_status st;

    atomic_init(&c.next, 0);
    if (helpers >= c.lane_count)
        helpers = c.lane_count - 1;
    if ((st = bs_new(cx, &cx->scratch, c.lane_count, &c.contexts)) != BS_OK ||
        (st = bs_new(cx, &cx->scratch, helpers + 1, &threads)) != BS_OK)
        goto done;
    for (int i = 0; i < c.lane_count; i++) {
        bs_ctx_init(&c.contexts[i], cx->gate);
        c.contexts[i].stop = cx->stop;
    }
    run_crew(&c, threads, helpers);
    for (int i = 0; i < c.lane_count; i++)
        bs_ctx_free(&c.contexts[i]);
done:
    bs_arena_rewind(&cx->scratch, temp);
    return st;
}
