/*
 * The interactive prompt, on libedit where standard input is a terminal.
 */
#ifndef CLI_PROMPT_H
#define CLI_PROMPT_H

#include "backsaw/script.h"

/*
 * Reads and runs what is typed until the end of input (Ctrl-D); Ctrl-C drops the line, or ends
 * what runs. Prints failures and goes on. Returns the exit status: 0, or 1 where standard input
 * is no terminal and the last entry failed.
 */
int cli_prompt(bs_session *session);

#endif
