/*
 * The program: reads the command line, makes a session, and runs what was asked for.
 *
 * Exit status: 0 done, 1 failed or nothing found, 2 wrong usage.
 */
#include "cli/prompt.h"

#include <limits.h>
#include <signal.h>
#include <stdio.h>
#include <stdlib.h>
#include <string.h>
#include <sys/ioctl.h>
#include <sys/stat.h>
#include <unistd.h>

static const char usage_text[] =
    "usage: backsaw [OPTION...] [FILE [ARG...]]\n"
    "       backsaw [OPTION...] COMMAND ...\n"
    "\n"
    "Without a file: the prompt on a terminal, else a script from standard input.\n"
    "\n"
    "  -e CODE     run this Lua code; may be given again\n"
    "  -i          the prompt after the script\n"
    "  -l PACK     use a pack, by file or by name; may be given again\n"
    "  -           a script from standard input\n"
    "  --bare      leave the standard library out\n"
    "  --help      this text\n"
    "  --version   name and version\n"
    "\n"
    "commands (each with --help):\n"
    "  check PACK...                     read packs, run their self-tests, lint them\n"
    "  pack list|show|new|hash|diff|pages   what packs there are, what is in them, what changed\n"
    "  catalogue build IN... -o OUT      make a catalogue from lists of compounds\n"
    "  plan SMILES [-c CATALOGUE]...     plan routes and print them\n"
    "\n"
    "At the prompt, help() lists topics. Proposals are for trained chemists to judge: the\n"
    "supplier's safety data sheet and local rules prevail.\n";

typedef struct options {
    const char *code[64]; /* -e and -l in their order; packs are marked in is_pack */
    bool is_pack[64];
    int code_count;
    bool interactive, bare, has_code;
    const char *script;  /* NULL for none, "-" for standard input */
    const char *command; /* NULL for none */
    int rest;            /* index of the first argument of script or command */
} options;

/* ---- Command line ---------------------------------------------------------------------- */

static int wrong_usage(const char *format, const char *what)
{
    fprintf(stderr, "backsaw: ");
    fprintf(stderr, format, what);
    fprintf(stderr, "\nusage: backsaw [OPTION...] [FILE [ARG...]]; --help tells all options\n");
    return 2;
}

static bool is_command(const char *word)
{
    return strcmp(word, "check") == 0 || strcmp(word, "catalogue") == 0 ||
           strcmp(word, "pack") == 0 || strcmp(word, "plan") == 0;
}

/* Takes the value of -e or -l, joined to the option or behind it. Returns 0 or an exit status. */
static int take_code(options *o, int argc, char **argv, int *i)
{
    const char *option = argv[*i], *value = option + 2;

    if (!*value) {
        if (*i + 1 >= argc)
            return wrong_usage(option[1] == 'e' ? "-e: code is expected%s"
                                                : "-l: the name of a pack is expected%s", "");
        value = argv[++*i];
    }
    if (o->code_count == (int)(sizeof o->code / sizeof *o->code))
        return wrong_usage("more than 64 options -e and -l%s", "");
    o->is_pack[o->code_count] = option[1] == 'l';
    o->has_code = o->has_code || option[1] == 'e';
    o->code[o->code_count++] = value;
    return 0;
}

/* Reads the command line. Returns -1 to go on, else an exit status. */
static int read_options(options *o, int argc, char **argv)
{
    int i, status;

    for (i = 1; i < argc && argv[i][0] == '-' && argv[i][1]; i++) {
        const char *option = argv[i];

        if (strcmp(option, "--") == 0) {
            i++;
            break;
        } else if (strcmp(option, "--help") == 0) {
            fputs(usage_text, stdout);
            return 0;
        } else if (strcmp(option, "--version") == 0) {
            printf("backsaw %s (Lua 5.4)\n", BACKSAW_VERSION);
            return 0;
        } else if (strcmp(option, "--bare") == 0) {
            o->bare = true;
        } else if (strcmp(option, "-i") == 0) {
            o->interactive = true;
        } else if (strncmp(option, "-e", 2) == 0 || strncmp(option, "-l", 2) == 0) {
            if ((status = take_code(o, argc, argv, &i)) != 0)
                return status;
        } else {
            return wrong_usage("unknown option '%s'", option);
        }
    }
    if (i < argc && is_command(argv[i]) && strcmp(argv[i - 1], "--") != 0)
        o->command = argv[i++];
    else if (i < argc)
        o->script = argv[i++];
    o->rest = i;
    return -1;
}

/* ---- Session --------------------------------------------------------------------------- */

/* Signal handlers know no argument; this is set once, before any signal can come. */
static bs_session *volatile running;

static void on_interrupt(int signal_number)
{
    (void)signal_number;
    if (running)
        bs_session_interrupt(running);
}

/* The line of progress on the terminal. */
typedef struct progress_line {
    bool shown;
    double when; /* seconds of the search at which the line was written */
} progress_line;

static void write_progress(const bs_plan_progress *now, char *line, size_t size)
{
    int used = snprintf(line, size, "%ld molecules, %ld steps, depth %d, %.0f s", now->molecules,
                        now->steps, now->depth, now->seconds);

    if (now->solved && used > 0 && (size_t)used < size)
        used += snprintf(line + used, size - (size_t)used, "; cheapest %.2f", now->cheapest);
    if (now->routes > 0 && used > 0 && (size_t)used < size)
        used += snprintf(line + used, size - (size_t)used, ", %ld route%s", now->routes,
                         now->routes == 1 ? "" : "s");
    if (used > 0 && (size_t)used < size)
        snprintf(line + used, size - (size_t)used, " (Ctrl-C ends the search)");
}

static void show_progress(void *payload, const bs_plan_progress *now)
{
    char line[200];
    progress_line *t = payload;
    struct winsize size;
    int width = 79;

    if (!now) {
        fputs("\r\033[K", stderr);
        t->shown = false;
        return;
    }
    if (t->shown && now->seconds - t->when < 0.1)
        return;
    t->shown = true;
    t->when = now->seconds;
    write_progress(now, line, sizeof line);
    if (ioctl(STDERR_FILENO, TIOCGWINSZ, &size) == 0 && size.ws_col > 1)
        width = size.ws_col - 1;
    fprintf(stderr, "\r\033[K%.*s", width, line); /* a line that wraps could not be erased */
    fflush(stderr);
}

static void say(void *payload, const char *line)
{
    (void)payload;
    fprintf(stderr, "%s\n", line);
}

/* The folder of a path, in `out`; "." without a slash. */
static void folder_of(const char *path, char *out, size_t size)
{
    const char *slash = strrchr(path, '/');
    size_t length = slash ? (size_t)(slash - path) : 0;

    if (!slash || length >= size)
        snprintf(out, size, ".");
    else
        snprintf(out, size, "%.*s", (int)(length ? length : 1), path);
}

/* The folder in which the program lies. */
static bool program_folder(char *out, size_t size)
{
    char path[PATH_MAX];
    ssize_t length = readlink("/proc/self/exe", path, sizeof path - 1);

    if (length <= 0)
        return false;
    path[length] = '\0';
    folder_of(path, out, size);
    return true;
}

/*
 * The commands that look at packs load the standard library after them, if at all, so that another
 * version of a standard pack can be looked at; what a pack needs is looked for beside it first.
 */
static void prepare_study(const options *o, int argc, char **argv, char *folder, size_t size,
                          bs_session_opts *opts)
{
    if (!o->command || (strcmp(o->command, "check") != 0 && strcmp(o->command, "pack") != 0))
        return;
    opts->later = true;
    for (int i = o->rest; i < argc && strcmp(o->command, "check") == 0; i++) {
        struct stat st;

        if (argv[i][0] == '-' || stat(argv[i], &st) != 0)
            continue;
        if (S_ISDIR(st.st_mode))
            snprintf(folder, size, "%s", argv[i]);
        else
            folder_of(argv[i], folder, size);
        opts->script_folder = folder;
        return;
    }
}

/* Prints why the session failed and gives the exit status. */
static int failed(const bs_session *session)
{
    fflush(stdout);
    fprintf(stderr, "backsaw: %s\n", session ? bs_session_message(session) : "out of memory");
    return 1;
}

/* Runs -e and -l in their order. */
static int run_codes(bs_session *session, const options *o)
{
    for (int i = 0; i < o->code_count; i++) {
        const char *code = o->code[i];
        bs_status st = o->is_pack[i] ? bs_session_use(session, code)
                                     : bs_session_run_text(session, "=-e", code, strlen(code));

        if (st != BS_OK)
            return failed(session);
    }
    return 0;
}

static int run_all(bs_session *session, const options *o, int argc, char **argv)
{
    bool terminal = isatty(STDIN_FILENO);
    const char *script = o->script;
    int status = 0;

    if (o->command) {
        if ((status = run_codes(session, o)) != 0)
            return status;
        if (bs_session_command(session, o->command, argc - o->rest, argv + o->rest, &status) !=
            BS_OK)
            return failed(session);
        return status;
    }
    if (!script && !o->has_code && !o->interactive && !terminal)
        script = "-";
    if (bs_session_arguments(session, script ? script : argv[0], argc - o->rest, argv + o->rest) !=
        BS_OK)
        return failed(session);
    status = run_codes(session, o);
    if (status == 0 && script &&
        bs_session_run_file(session, strcmp(script, "-") == 0 ? NULL : script) != BS_OK)
        status = failed(session);
    if (o->interactive || (!script && !o->has_code))
        status = cli_prompt(session);
    return status;
}

int main(int argc, char **argv)
{
    options o = { 0 };
    char program[PATH_MAX], script[PATH_MAX];
    struct sigaction action = { .sa_handler = on_interrupt, .sa_flags = SA_RESTART };
    progress_line progress = { 0 };
    bs_session_opts opts = { .payload = &progress };
    bs_session *session;
    int status = read_options(&o, argc, argv);

    if (status >= 0)
        return status;
    if (o.script && strcmp(o.script, "-") != 0) {
        folder_of(o.script, script, sizeof script);
        opts.script_folder = script;
    }
    prepare_study(&o, argc, argv, script, sizeof script, &opts);
    opts.program_folder = program_folder(program, sizeof program) ? program : NULL;
    opts.pack_path = getenv("BACKSAW_PATH");
    opts.bare = o.bare;
    opts.say = say;
    opts.progress = isatty(STDERR_FILENO) ? show_progress : NULL;
    if (bs_session_new(&opts, &session) != BS_OK) {
        status = failed(session);
    } else {
        running = session;
        sigaction(SIGINT, &action, NULL);
        status = run_all(session, &o, argc, argv);
        running = NULL;
    }
    bs_session_free(session);
    if (fflush(stdout) != 0) {
        fprintf(stderr, "backsaw: standard output cannot be written\n");
        status = status ? status : 1;
    }
    return status;
}
