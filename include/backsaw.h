/* backsaw: everything. Each module's header explains itself. */
#ifndef BACKSAW_H
#define BACKSAW_H

#include "backsaw/core.h"
#include "backsaw/mol.h"
#include "backsaw/descriptor.h"
#include "backsaw/draft.h"
#include "backsaw/layout.h"
#include "backsaw/format.h"
#include "backsaw/direct.h"
#include "backsaw/file.h"
#include "backsaw/match.h"
#include "backsaw/polarity.h"
#include "backsaw/rule.h"
#include "backsaw/group.h"
#include "backsaw/why.h"
#include "backsaw/example.h"
#include "backsaw/catalogue.h"
#include "backsaw/route.h"
#include "backsaw/search.h"
#include "backsaw/report.h"

#endif
