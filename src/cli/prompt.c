/*
 * The prompt: lines from libedit on a terminal, or from a pipe; continuation lines; history.
 */
#include "cli/prompt.h"

#include <ctype.h>
#include <histedit.h>
#include <limits.h>
#include <stdio.h>
#include <stdlib.h>
#include <string.h>
#include <sys/stat.h>
#include <unistd.h>

#define HISTORY_SIZE 2000

typedef struct prompt {
    bs_session *session;
    bs_ctx cx;
    bs_text entry;   /* what was typed so far */
    bool continued;  /* the entry needs more lines */
    bool dropped;    /* Ctrl-C */
    bool failed;     /* the last entry */
    EditLine *edit;  /* NULL where input is no terminal */
    History *history;
    char sign[16];   /* what stands before the line */
    char history_file[PATH_MAX];
} prompt;

/* ---- Entries --------------------------------------------------------------------------- */

/* Adds a line to the entry and runs it if it is whole. */
static void take_line(prompt *p, const char *line, size_t length)
{
    bool incomplete;
    bs_status st;

    if (bs_text_add(&p->entry, line, length) != BS_OK) {
        fprintf(stderr, "out of memory\n");
        return;
    }
    st = bs_session_enter(p->session, p->entry.data, p->entry.length, &incomplete);
    if (st == BS_OK && incomplete) {
        p->continued = true;
        return;
    }
    fflush(stdout);
    p->failed = st != BS_OK;
    if (p->failed)
        fprintf(stderr, "%s\n", bs_session_message(p->session));
    bs_text_clear(&p->entry);
    p->continued = false;
}

static void drop_entry(prompt *p)
{
    bs_text_clear(&p->entry);
    p->continued = false;
}

/* ---- History --------------------------------------------------------------------------- */

/* Makes the folders of a path, as far as they are missing. */
static void make_folders(char *path)
{
    for (char *at = path + 1; *at; at++) {
        if (*at != '/')
            continue;
        *at = '\0';
        mkdir(path, 0700);
        *at = '/';
    }
}

/* The history lies in the state folder of the XDG base directory specification. */
static void find_history(prompt *p)
{
    const char *state = getenv("XDG_STATE_HOME"), *home = getenv("HOME");
    int length = -1;

    if (state && state[0] == '/')
        length = snprintf(p->history_file, sizeof p->history_file, "%s/backsaw/history", state);
    else if (home && home[0] == '/')
        length = snprintf(p->history_file, sizeof p->history_file,
                          "%s/.local/state/backsaw/history", home);
    if (length <= 0 || (size_t)length >= sizeof p->history_file) {
        p->history_file[0] = '\0';
        return;
    }
    make_folders(p->history_file);
}

static void open_history(prompt *p)
{
    HistEvent event;

    p->history = history_init();
    if (!p->history)
        return;
    history(p->history, &event, H_SETSIZE, HISTORY_SIZE);
    history(p->history, &event, H_SETUNIQUE, 1);
    find_history(p);
    if (p->history_file[0])
        history(p->history, &event, H_LOAD, p->history_file);
    el_set(p->edit, EL_HIST, history, p->history);
}

static void close_history(prompt *p)
{
    HistEvent event;

    if (!p->history)
        return;
    if (p->history_file[0])
        history(p->history, &event, H_SAVE, p->history_file);
    history_end(p->history);
}

/* ---- Keys ------------------------------------------------------------------------------ */

static prompt *prompt_of(EditLine *edit)
{
    void *data = NULL;

    el_get(edit, EL_CLIENTDATA, &data);
    return data;
}

static char *prompt_text(EditLine *edit)
{
    prompt *p = prompt_of(edit);

    snprintf(p->sign, sizeof p->sign, "%s", p->continued ? "     ... " : "backsaw> ");
    return p->sign;
}

static unsigned char on_ctrl_c(EditLine *edit, int key)
{
    (void)key;
    prompt_of(edit)->dropped = true;
    fputs("^C\n", stdout);
    fflush(stdout);
    return CC_NEWLINE;
}

/* The length of what all names have in common. */
static size_t common_length(char *const *names, int count)
{
    size_t length = strlen(names[0]);

    for (int i = 1; i < count; i++) {
        size_t k = 0;

        while (k < length && names[i][k] == names[0][k])
            k++;
        length = k;
    }
    return length;
}

static void list_names(char *const *names, int count)
{
    putchar('\n');
    for (int i = 0; i < count; i++)
        printf("%s%s", names[i], i + 1 < count ? "  " : "\n");
}

/* Tab: completes the name before the cursor, or lists what it could be. */
static unsigned char on_tab(EditLine *edit, int key)
{
    prompt *p = prompt_of(edit);
    const LineInfo *line = el_line(edit);
    const char *start = line->cursor;
    unsigned char result = CC_ERROR;
    bs_arena home;
    char word[256], **names;
    size_t length, common;
    int count = 0;

    (void)key;
    while (start > line->buffer && (isalnum((unsigned char)start[-1]) || strchr("_.:", start[-1])))
        start--;
    length = (size_t)(line->cursor - start);
    if (length == 0)
        return el_insertstr(edit, "    ") == 0 ? CC_REFRESH : CC_ERROR;
    if (length >= sizeof word)
        return CC_ERROR;
    memcpy(word, start, length);
    word[length] = '\0';
    bs_arena_init(&home, p->cx.gate);
    if (bs_session_complete(p->session, &home, word, &names, &count) == BS_OK && count > 0) {
        common = common_length(names, count);
        if (common > length) {
            names[0][common] = '\0';
            if (el_insertstr(edit, names[0] + length) == 0)
                result = CC_REFRESH;
        } else if (count > 1) {
            list_names(names, count);
            result = CC_REDISPLAY;
        }
    }
    bs_arena_free(&home);
    return result;
}

/* ---- Loops ----------------------------------------------------------------------------- */

static bool open_edit(prompt *p)
{
    p->edit = el_init("backsaw", stdin, stdout, stderr);
    if (!p->edit)
        return false;
    el_set(p->edit, EL_CLIENTDATA, p);
    el_set(p->edit, EL_PROMPT, prompt_text);
    el_set(p->edit, EL_EDITOR, "emacs");
    el_set(p->edit, EL_ADDFN, "backsaw-drop", "drop the line", on_ctrl_c);
    el_set(p->edit, EL_ADDFN, "backsaw-complete", "complete a name", on_tab);
    open_history(p);
    el_source(p->edit, NULL);
    /* While a line is edited, Ctrl-C is a key; while code runs, it is a signal. */
    el_set(p->edit, EL_SETTY, "-d", "-isig", NULL);
    el_set(p->edit, EL_BIND, "^C", "backsaw-drop", NULL);
    el_set(p->edit, EL_BIND, "^I", "backsaw-complete", NULL);
    return true;
}

static bool is_blank(const char *line)
{
    return line[strspn(line, " \t\r\n")] == '\0';
}

static void run_terminal(prompt *p)
{
    HistEvent event;
    const char *line;
    int length;

    fprintf(stderr, "backsaw %s, Lua 5.4. help() lists topics, Ctrl-D leaves.\n", BACKSAW_VERSION);
    while ((line = el_gets(p->edit, &length)) != NULL && length > 0) {
        if (p->dropped) {
            p->dropped = false;
            drop_entry(p);
            continue;
        }
        if (is_blank(line) && !p->continued)
            continue;
        if (p->history && !is_blank(line))
            history(p->history, &event, H_ENTER, line);
        take_line(p, line, (size_t)length);
    }
    fputc('\n', stderr);
}

/* Lines from a pipe: the same without prompt text and keys. */
static void run_pipe(prompt *p)
{
    char *line = NULL;
    size_t room = 0;
    ssize_t length;

    while ((length = getline(&line, &room, stdin)) >= 0)
        if (!is_blank(line) || p->continued)
            take_line(p, line, (size_t)length);
    free(line);
    if (p->continued) {
        fprintf(stderr, "the last entry is incomplete\n");
        p->failed = true;
    }
}

int cli_prompt(bs_session *session)
{
    prompt p = { .session = session };
    bool terminal = isatty(STDIN_FILENO) && isatty(STDOUT_FILENO);

    bs_ctx_init(&p.cx, NULL);
    bs_text_init(&p.entry, &p.cx);
    if (terminal && open_edit(&p)) {
        run_terminal(&p);
        close_history(&p);
        el_end(p.edit);
        p.failed = false;
    } else {
        run_pipe(&p);
    }
    bs_text_free(&p.entry);
    bs_ctx_free(&p.cx);
    return p.failed ? 1 : 0;
}
