/*
 * Transforms backwards and forwards on facts of the trade (textbook chemistry, from memory:
 * Clayden, Greeves & Warren, Organic Chemistry).
 */
#include "rule/case.h"

typedef struct book {
    fixture *f;
    bs_rules *rules;
} book;

static book new_book(void **state)
{
    book b = {*state, NULL};

    check_ok(b.f, bs_rules_new(&b.f->cx, &b.rules));
    return b;
}

static void add_synthon(book *b, const char *name, bs_synthon_kind kind,
                        const bs_equivalent_def *equivalents, int count)
{
    bs_synthon_def def = {
        .name = name, .kind = kind, .equivalents = equivalents, .equivalent_count = count};

    check_ok(b->f, bs_rules_add_synthon(&b->f->cx, b->rules, &def));
}

static int add_from(book *b, const char *name, const char *target, const char *from)
{
    bs_transform_def def = {.name = name,
                            .kind = BS_INTERCONVERSION,
                            .target = target,
                            .from = from,
                            .hook_when = -1,
                            .hook_prefer = -1};
    int index = -1;

    check_ok(b->f, bs_rules_add_transform(&b->f->cx, b->rules, &def, &index));
    return index;
}

static int add_cut(book *b, const char *name, const char *target, int acceptor_map,
                   const char *acceptor, int donor_map, const char *donor)
{
    bs_transform_def def = {.name = name,
                            .target = target,
                            .cut = {acceptor_map, donor_map},
                            .acceptor_map = acceptor_map,
                            .donor_map = donor_map,
                            .acceptor = acceptor,
                            .donor = donor,
                            .hook_when = -1,
                            .hook_prefer = -1};
    int index = -1;

    check_ok(b->f, bs_rules_add_transform(&b->f->cx, b->rules, &def, &index));
    return index;
}

static bs_steps back(book *b, int index, const char *product)
{
    bs_steps steps = {0};

    check_ok(b->f, bs_rules_back(&b->f->cx, &b->f->home, b->rules, index, read_mol(b->f, product),
                                 NULL, 0, &steps));
    return steps;
}

static bs_product_sets forth(book *b, int index, const char *first, const char *second)
{
    const bs_mol *reactants[2] = {read_mol(b->f, first), second ? read_mol(b->f, second) : NULL};
    bs_product_sets sets = {0};

    check_ok(b->f, bs_rules_forth(&b->f->cx, &b->f->home, b->rules, index, reactants,
                                  second ? 2 : 1, NULL, &sets));
    return sets;
}

static bool has_step(book *b, const bs_steps *steps, const char *one, const char *two)
{
    char *a = canonical(b->f, one), *c = two ? canonical(b->f, two) : NULL;

    for (int i = 0; i < steps->count; i++) {
        const bs_step *s = &steps->items[i];
        bool first = false, second = !c;

        for (int k = 0; k < s->precursor_count; k++) {
            first = first || strcmp(s->smiles[k], a) == 0;
            second = second || (c && strcmp(s->smiles[k], c) == 0);
        }
        if (first && second && s->precursor_count == 1 + (c != NULL))
            return true;
    }
    return false;
}

/* 1 expected, 0 rival, -1 not among the products. */
static int verdict_on(book *b, const bs_product_sets *sets, const char *product)
{
    char *text = canonical(b->f, product);

    for (int i = 0; i < sets->count; i++) {
        if (strcmp(sets->items[i].outcome.smiles[0], text) == 0)
            return sets->items[i].expected;
    }
    return -1;
}

static bool has_rival(book *b, const bs_step *step, const char *product)
{
    char *text = canonical(b->f, product);

    for (int i = 0; i < step->rivals.count; i++) {
        if (strcmp(step->rivals.items[i].smiles[0], text) == 0)
            return true;
    }
    return false;
}

/* ---- Interconversions ------------------------------------------------------------------------ */

static void ketone_reduction__takes_the_alcohol_back_to_the_ketone(void **state)
{
    book b = new_book(state);
    int index = add_from(&b, "ketone and hydride", "[CX4;H1:1]([#6:3])([#6:4])[OX2H1:2]",
                         "[C;H0:1](=[O;H0:2])([#6:3])[#6:4]");
    bs_steps steps = back(&b, index, "CC(O)CC");

    assert_int_equal(steps.count, 1);
    assert_true(has_step(&b, &steps, "CC(=O)CC", NULL));
    assert_false(steps.items[0].stereo_open);
    assert_int_equal(back(&b, index, "CC(C)(C)O").count, 0);
    bs_rules_free(b.rules);
}

/* The reagent is achiral: one enantiomer is made only with a mirror image beside it. */
static void ketone_reduction__leaves_the_new_centre_open(void **state)
{
    book b = new_book(state);
    int index = add_from(&b, "ketone and hydride", "[CX4;H1:1]([#6:3])([#6:4])[OX2H1:2]",
                         "[C;H0:1](=[O;H0:2])([#6:3])[#6:4]");
    bs_steps steps = back(&b, index, "C[C@H](O)[C@H](C)CC");

    assert_int_equal(steps.count, 1);
    assert_true(has_step(&b, &steps, "CC(=O)[C@H](C)CC", NULL));
    assert_true(steps.items[0].stereo_open);
    bs_rules_free(b.rules);
}

/* Hydration: Markovnikov by acid, the other way by hydroboration; each lists the other as rival. */
static void hydration__lists_the_other_regioisomer_as_rival(void **state)
{
    book b = new_book(state);
    int acid = add_from(&b, "acid hydration", "[CX4;H0,H1:1]([OX2H:3])[CX4;H3:2]", "[C:1]=[C:2]");
    int boron = add_from(&b, "hydroboration", "[CX4;H2:1]([OX2H:3])[CX4;!H0:2]", "[C:1]=[C:2]");
    bs_steps steps = back(&b, acid, "CCCC(C)O");
    bs_product_sets sets;

    assert_int_equal(steps.count, 1);
    assert_true(has_step(&b, &steps, "CCCC=C", NULL));
    assert_true(has_rival(&b, &steps.items[0], "CCCCCO"));
    steps = back(&b, boron, "CCCCCO");
    assert_int_equal(steps.count, 1);
    assert_true(has_rival(&b, &steps.items[0], "CCCC(C)O"));
    sets = forth(&b, boron, "CCCC=C", NULL);
    assert_int_equal(sets.count, 2);
    assert_true(sets.items[0].expected);
    assert_int_equal(verdict_on(&b, &sets, "CCCCCO"), 1);
    assert_int_equal(verdict_on(&b, &sets, "CCCC(C)O"), 0);
    bs_rules_free(b.rules);
}

static void lindlar__makes_the_z_alkene_only(void **state)
{
    book b = new_book(state);
    int lindlar = add_from(&b, "Lindlar", "[#6:3]/[CX3;H1:1]=[CX3;H1:2]\\[#6:4]",
                           "[#6:3][CX2;H0:1]#[CX2;H0:2][#6:4]");
    int sodium = add_from(&b, "dissolving metal", "[#6:3]/[CX3;H1:1]=[CX3;H1:2]/[#6:4]",
                          "[#6:3][CX2;H0:1]#[CX2;H0:2][#6:4]");
    bs_product_sets sets = forth(&b, lindlar, "CCC#CCC", NULL);

    assert_int_equal(back(&b, lindlar, "CC/C=C\\CC").count, 1);
    assert_int_equal(back(&b, lindlar, "CC/C=C/CC").count, 0);
    assert_int_equal(back(&b, sodium, "CC/C=C/CC").count, 1);
    assert_int_equal(back(&b, sodium, "CC/C=C\\CC").count, 0);
    assert_int_equal(back(&b, sodium, "CCC=CCC").count, 0);
    assert_int_equal(sets.count, 1);
    assert_int_equal(verdict_on(&b, &sets, "CC/C=C\\CC"), 1);
    bs_rules_free(b.rules);
}

/* Osmylation is syn: a ring alkene gives the cis diol, whichever face is attacked. */
static void osmylation__makes_cis_diols_only(void **state)
{
    book b = new_book(state);
    int index =
        add_from(&b, "osmylation", "[#6;R:5][C@;X4;H1;R:1]([OX2H1])[C@;X4;H1;R:3]([OX2H1])[#6;R:6]",
                 "[#6;R:5][CX3;H1;R:1]=[CX3;H1;R:3][#6;R:6]");

    assert_int_equal(back(&b, index, "O[C@@H]1CCCC[C@@H]1O").count, 1);
    assert_int_equal(back(&b, index, "O[C@@H]1CCCC[C@H]1O").count, 0);
    assert_int_equal(back(&b, index, "OC1CCCCC1O").count, 1);
    /* With another centre in the ring the two faces give two diastereomers; both are cis. */
    assert_int_equal(back(&b, index, "O[C@@H]1C[C@H](C)CC[C@@H]1O").count, 1);
    assert_int_equal(back(&b, index, "O[C@@H]1C[C@@H](C)CC[C@@H]1O").count, 1);
    assert_int_equal(back(&b, index, "O[C@@H]1C[C@H](C)CC[C@H]1O").count, 0);
    bs_rules_free(b.rules);
}

/* Mitsunobu: inversion, whichever hand the alcohol has. */
static void mitsunobu__turns_either_hand(void **state)
{
    book b = new_book(state);
    int index = add_from(&b, "Mitsunobu azide", "[C@;X4;H1:1]([#6:4])([#6:6])[NX2:2]=[N+:3]=[N-:5]",
                         "[C@@;X4;H1:1]([#6:4])([#6:6])[OX2;H1]");
    bs_steps r = back(&b, index, "C[C@H](N=[N+]=[N-])CC");
    bs_steps s = back(&b, index, "C[C@@H](N=[N+]=[N-])CC");

    assert_int_equal(r.count, 1);
    assert_true(has_step(&b, &r, "C[C@@H](O)CC", NULL));
    assert_int_equal(s.count, 1);
    assert_true(has_step(&b, &s, "C[C@H](O)CC", NULL));
    assert_false(r.items[0].stereo_open);
    bs_rules_free(b.rules);
}

/* ---- Disconnections ----------------------------------------------------------------------------
 */

static const bs_equivalent_def halides[] = {{.attach = "Br"}, {.attach = "Cl"}};
static const bs_equivalent_def proton[] = {{.attach = "[H]"}};
static const bs_equivalent_def sodium[] = {{.attach = "[Na]", .ionic = true}};
static const bs_equivalent_def carbonyl[] = {{.rewrite = "[C:1]-[OX2H:2]>>[C:1]=[O:2]"}};
static const bs_equivalent_def grignard[] = {{.attach = "[Mg]Br"}};

static void cyanide__displaces_a_primary_halide(void **state)
{
    book b = new_book(state);
    bs_steps steps;
    bs_product_sets sets;
    int index;

    add_synthon(&b, "alkyl", BS_ACCEPTOR, halides, 2);
    add_synthon(&b, "cyanide", BS_DONOR, sodium, 1);
    index = add_cut(&b, "cyanide displacement", "[#6:4][CX4;H2:1]-!@[C:2]#[N:3]", 1, "Alkyl", 2,
                    "cyanide");
    steps = back(&b, index, "CCCC#N");
    assert_int_equal(steps.count, 2);
    assert_true(has_step(&b, &steps, "CCCBr", "[Na+].[C-]#N"));
    assert_true(has_step(&b, &steps, "CCCCl", "[Na+].[C-]#N"));
    assert_int_equal(back(&b, index, "CC(C)(C)C#N").count, 0);
    sets = forth(&b, index, "[C-]#N.[Na+]", "CCCBr");
    assert_int_equal(verdict_on(&b, &sets, "CCCC#N"), 1);
    /* A tertiary halide matches too, and its product is not what the rule promises. */
    sets = forth(&b, index, "CC(C)(C)Br", "[Na+].[C-]#N");
    assert_int_equal(verdict_on(&b, &sets, "CC(C)(C)C#N"), 0);
    bs_rules_free(b.rules);
}

static void williamson__gives_ethers_from_both_sides(void **state)
{
    book b = new_book(state);
    bs_steps steps;
    int index;

    add_synthon(&b, "alkyl", BS_ACCEPTOR, halides, 1);
    add_synthon(&b, "alcohol", BS_DONOR, proton, 1);
    index =
        add_cut(&b, "Williamson ether", "[CX4;H2,H3:1]-!@[OX2:2][#6:3]", 1, "alkyl", 2, "alcohol");
    steps = back(&b, index, "CCOCCC");
    assert_int_equal(steps.count, 2);
    assert_true(has_step(&b, &steps, "CCBr", "CCCO"));
    assert_true(has_step(&b, &steps, "CCO", "CCCBr"));
    steps = back(&b, index, "COC(C)(C)C");
    assert_int_equal(steps.count, 1);
    assert_true(has_step(&b, &steps, "CBr", "CC(C)(C)O"));
    bs_rules_free(b.rules);
}

static void amide__comes_from_acid_chloride_and_amine(void **state)
{
    book b = new_book(state);
    static const bs_equivalent_def chloride[] = {{.attach = "Cl"}};
    bs_steps steps;
    bs_product_sets sets;
    int index;

    add_synthon(&b, "acyl", BS_ACCEPTOR, chloride, 1);
    add_synthon(&b, "amine", BS_DONOR, proton, 1);
    index = add_cut(&b, "amide", "[#6:3][CX3:1](=[O:4])-!@[NX3;!$(N[CX3]=O)!H0,$(N(C)C):2]", 1,
                    "acyl", 2, "amine");
    steps = back(&b, index, "CC(=O)NCCNC");
    assert_int_equal(steps.count, 1);
    assert_true(has_step(&b, &steps, "CC(=O)Cl", "NCCNC"));
    /* The other nitrogen of the diamine reacts as well. */
    assert_true(has_rival(&b, &steps.items[0], "CC(=O)N(C)CCN"));
    sets = forth(&b, index, "NCC", "CC(=O)Cl");
    assert_true(verdict_on(&b, &sets, "CCNC(C)=O") >= 0);
    bs_rules_free(b.rules);
}

/* Indazole is methylated at N1 and at N2, whichever nitrogen is drawn with the hydrogen. */
static void azole__is_alkylated_at_either_nitrogen(void **state)
{
    book b = new_book(state);
    bs_steps steps;
    int index;

    add_synthon(&b, "alkyl", BS_ACCEPTOR, halides, 1);
    add_synthon(&b, "azole", BS_DONOR, proton, 1);
    index = add_cut(&b, "azole alkylation", "[n;r5;X3:2]-!@[CX4:1]", 1, "alkyl", 2, "azole");
    steps = back(&b, index, "Cn1ncc2ccccc12");
    assert_int_equal(steps.count, 1);
    assert_true(has_step(&b, &steps, "CBr", "c1ccc2[nH]ncc2c1"));
    assert_true(has_rival(&b, &steps.items[0], "Cn1cc2ccccc2n1"));
    /* Where the azole takes no part, its other forms are no products. */
    index = add_from(&b, "ester hydrolysis", "[CX3:1](=[O:2])[OX2H:3]", "[C:1](=[O:2])[O:3]C");
    steps = back(&b, index, "OC(=O)c1c[nH]cn1");
    assert_int_equal(steps.count, 1);
    assert_int_equal(steps.items[0].rivals.count, 0);
    bs_rules_free(b.rules);
}

static void grignard__adds_to_a_carbonyl(void **state)
{
    book b = new_book(state);
    bs_steps steps;
    int index;

    add_synthon(&b, "hydroxyalkyl", BS_ACCEPTOR, carbonyl, 1);
    add_synthon(&b, "organomagnesium", BS_DONOR, grignard, 1);
    index = add_cut(&b, "Grignard addition", "[CX4:1]([OX2H:3])-!@[#6:2]", 1, "hydroxyalkyl", 2,
                    "organomagnesium");
    steps = back(&b, index, "CCC(C)(O)c1ccccc1");
    assert_int_equal(steps.count, 3);
    assert_true(has_step(&b, &steps, "CC[Mg]Br", "CC(=O)c1ccccc1"));
    assert_true(has_step(&b, &steps, "C[Mg]Br", "CCC(=O)c1ccccc1"));
    assert_true(has_step(&b, &steps, "Br[Mg]c1ccccc1", "CCC(C)=O"));
    bs_rules_free(b.rules);
}

static void reductive_amination__joins_ketone_and_amine(void **state)
{
    book b = new_book(state);
    bs_steps steps;
    int index = add_from(&b, "reductive amination",
                         "[#6:4][CX4;H1:1]([CX4:6])-!@[NX3;!$(N[C,S]=[O,S,N]);!H2:2]",
                         "[#6:4][CX3;H0:1]([CX4:6])=[OX1].[NX3:2]");

    steps = back(&b, index, "CC(C)NCc1ccccc1");
    assert_int_equal(steps.count, 1);
    assert_true(has_step(&b, &steps, "CC(C)=O", "NCc1ccccc1"));
    assert_int_equal(back(&b, index, "CC(C)NC(C)=O").count, 0);
    bs_rules_free(b.rules);
}

/* Wittig: the cut double bond leaves a carbonyl on one side and a phosphorane on the other. */
static void wittig__cuts_a_double_bond(void **state)
{
    book b = new_book(state);
    static const bs_equivalent_def oxo[] = {{.attach = "=O"}};
    static const bs_equivalent_def ylide[] = {{.attach = "=P(c1ccccc1)(c1ccccc1)c1ccccc1"}};
    bs_steps steps;
    int index;

    add_synthon(&b, "alkylidene", BS_ACCEPTOR, oxo, 1);
    add_synthon(&b, "ylide", BS_DONOR, ylide, 1);
    index = add_cut(&b, "Wittig", "[CX3:1]=!@[CX3:2]", 1, "alkylidene", 2, "ylide");
    steps = back(&b, index, "C=C1CCCCC1");
    assert_int_equal(steps.count, 2);
    assert_true(has_step(&b, &steps, "O=C1CCCCC1", "C=P(c1ccccc1)(c1ccccc1)c1ccccc1"));
    assert_true(has_step(&b, &steps, "C=O", "C1CCCCC1=P(c1ccccc1)(c1ccccc1)c1ccccc1"));
    bs_rules_free(b.rules);
}

/* Crossed aldol: one rule, both roles for either partner; the self-aldol uses two equivalents. */
static void aldol__counts_equal_halves(void **state)
{
    book b = new_book(state);
    bs_steps steps;
    int index;

    add_synthon(&b, "hydroxyalkyl", BS_ACCEPTOR, carbonyl, 1);
    add_synthon(&b, "enolate", BS_DONOR, proton, 1);
    index = add_cut(&b, "aldol", "[CX4:1]([OX2H:3])-!@[CX4:2][CX3:4]=[O:5]", 1, "hydroxyalkyl", 2,
                    "enolate");
    steps = back(&b, index, "CCC(O)C(C)C=O");
    assert_int_equal(steps.count, 1);
    assert_int_equal(steps.items[0].precursor_count, 1);
    assert_string_equal(steps.items[0].smiles[0], canonical(b.f, "CCC=O"));
    assert_true(steps.items[0].equivalents[0] == 2);
    steps = back(&b, index, "OC(c1ccccc1)CC(C)=O");
    assert_int_equal(steps.count, 1);
    assert_true(has_step(&b, &steps, "O=Cc1ccccc1", "CC(C)=O"));
    /* Acetone with itself, and benzaldehyde at the other carbon of acetone, are the same or more.
     */
    assert_true(has_rival(&b, &steps.items[0], "CC(=O)CC(O)c1ccccc1") == false);
    bs_rules_free(b.rules);
}

static void intramolecular_cut__leaves_one_molecule(void **state)
{
    book b = new_book(state);
    static const bs_equivalent_def acid[] = {{.attach = "O"}};
    bs_steps steps;
    int ring, open;

    add_synthon(&b, "acyl acid", BS_ACCEPTOR, acid, 1);
    add_synthon(&b, "alcohol", BS_DONOR, proton, 1);
    ring = add_cut(&b, "lactone closure", "[CX3:1](=[O:3])-;@[OX2:2][CX4:4]", 1, "acyl acid", 2,
                   "alcohol");
    open = add_cut(&b, "ester", "[CX3:1](=[O:3])-!@[OX2:2][CX4:4]", 1, "acyl acid", 2, "alcohol");
    steps = back(&b, ring, "O=C1CCCCO1");
    assert_int_equal(steps.count, 1);
    assert_true(has_step(&b, &steps, "OCCCCC(=O)O", NULL));
    assert_int_equal(back(&b, open, "O=C1CCCCO1").count, 0);
    steps = back(&b, -1, "CC(=O)OCC");
    assert_int_equal(steps.count, 1);
    assert_int_equal(steps.items[0].transform, open);
    bs_rules_free(b.rules);
}

/* ---- The book
 * ------------------------------------------------------------------------------------- */

static void names__ignore_case_spaces_and_hyphens(void **state)
{
    book b = new_book(state);
    static const char *also[] = {"Other Name"};
    bs_transform_def def = {.name = "ketone-reduction",
                            .also = {also, 1},
                            .target = "[C:1]O",
                            .from = "[C:1]=O",
                            .hook_when = -1,
                            .hook_prefer = -1};
    int index = -1;

    check_ok(b.f, bs_rules_add_transform(&b.f->cx, b.rules, &def, &index));
    assert_int_equal(bs_rules_find(b.rules, "Ketone Reduction"), index);
    assert_int_equal(bs_rules_find(b.rules, "othername"), index);
    assert_int_equal(bs_rules_find(b.rules, "ketone"), -1);
    assert_int_equal(bs_rules_add_transform(&b.f->cx, b.rules, &def, &index), BS_EVALUE);
    assert_int_equal(bs_rules_count(b.rules), 1);
    assert_string_equal(bs_rules_transform(b.rules, 0)->target, "[C:1]O");
    bs_rules_free(b.rules);
}

static void check_refused(book *b, bs_transform_def def, bs_status wanted, const char *part)
{
    int index;

    def.name = "x";
    def.hook_when = def.hook_prefer = -1;
    assert_int_equal(bs_rules_add_transform(&b->f->cx, b->rules, &def, &index), wanted);
    if (!strstr(b->f->cx.error.message, part))
        fail_msg("\"%s\" does not say \"%s\"", b->f->cx.error.message, part);
    assert_int_equal(bs_rules_count(b->rules), 0);
}

static void definitions__mistakes_name_the_field(void **state)
{
    book b = new_book(state);

    add_synthon(&b, "amine", BS_DONOR, proton, 1);
    add_synthon(&b, "alkyl", BS_ACCEPTOR, halides, 1);
    check_refused(&b, (bs_transform_def){.target = "[C:1", .from = "[C:1]"}, BS_ESYNTAX, "target:");
    check_refused(&b, (bs_transform_def){.target = "[C:1]", .from = "[C:2]"}, BS_EVALUE,
                  "map number 2");
    check_refused(&b, (bs_transform_def){.target = "[C:1]"}, BS_EVALUE, "from or cut");
    check_refused(&b,
                  (bs_transform_def){.target = "[C:1][N:2]",
                                     .cut = {1, 3},
                                     .acceptor_map = 1,
                                     .donor_map = 3,
                                     .acceptor = "alkyl",
                                     .donor = "amine"},
                  BS_EVALUE, "cut:");
    check_refused(&b,
                  (bs_transform_def){.target = "[C:1][N:2]",
                                     .cut = {1, 2},
                                     .acceptor_map = 1,
                                     .donor_map = 2,
                                     .acceptor = "aryl",
                                     .donor = "amine"},
                  BS_ENOTFOUND, "aryl");
    check_refused(&b,
                  (bs_transform_def){.target = "[C:1][N:2]",
                                     .cut = {1, 2},
                                     .acceptor_map = 1,
                                     .donor_map = 2,
                                     .acceptor = "amine",
                                     .donor = "amine"},
                  BS_EVALUE, "donor");
    bs_rules_free(b.rules);
}

static void synthons__mistakes_name_the_field(void **state)
{
    book b = new_book(state);
    static const bs_equivalent_def bad[] = {{.attach = "C("}};
    static const bs_equivalent_def none[] = {{.name = "nothing"}};
    bs_synthon_def def = {.name = "s", .kind = BS_DONOR, .equivalents = bad, .equivalent_count = 1};

    assert_int_equal(bs_rules_add_synthon(&b.f->cx, b.rules, &def), BS_ESYNTAX);
    assert_non_null(strstr(b.f->cx.error.message, "equivalents: "));
    def.equivalents = none;
    assert_int_equal(bs_rules_add_synthon(&b.f->cx, b.rules, &def), BS_EVALUE);
    add_synthon(&b, "s", BS_DONOR, proton, 1);
    def.equivalents = proton;
    assert_int_equal(bs_rules_add_synthon(&b.f->cx, b.rules, &def), BS_EVALUE);
    bs_rules_free(b.rules);
}

/* ---- Hooks
 * ------------------------------------------------------------------------------------------ */

static bs_status fewer_carbons(void *payload, bs_ctx *cx, int hook, const bs_mol *product,
                               const bs_site *site, bool *allowed)
{
    (void)payload, (void)cx;
    assert_int_equal(hook, 7);
    assert_int_equal(site->maps[0], 1);
    *allowed = bs_mol_atom_carbons(product, (int)site->atoms[0]) <=
               bs_mol_atom_carbons(product, (int)site->atoms[1]);
    return BS_OK;
}

static bs_status score_carbons(void *payload, bs_ctx *cx, int hook, const bs_mol *product,
                               const bs_site *site, double *score)
{
    (void)payload, (void)cx;
    assert_int_equal(hook, 8);
    *score = -bs_mol_atom_carbons(product, (int)site->atoms[0]);
    return BS_OK;
}

static void hooks__decide_and_order(void **state)
{
    book b = new_book(state);
    bs_rule_hooks hooks = {.when = fewer_carbons, .prefer = score_carbons};
    bs_transform_def def = {.name = "hydroboration",
                            .target = "[CX4:1]([OX2H:3])[CX4;!H0:2]",
                            .from = "[C:1]=[C:2]",
                            .hook_when = 7,
                            .hook_prefer = 8};
    const bs_mol *alkene = read_mol(b.f, "CC(C)=CC");
    bs_product_sets sets;
    bs_steps steps;
    int index = -1;

    check_ok(b.f, bs_rules_add_transform(&b.f->cx, b.rules, &def, &index));
    check_ok(b.f, bs_rules_back(&b.f->cx, &b.f->home, b.rules, index, read_mol(b.f, "CC(O)C(C)C"),
                                &hooks, 0, &steps));
    assert_true(has_step(&b, &steps, "CC(C)=CC", NULL));
    check_ok(b.f, bs_rules_back(&b.f->cx, &b.f->home, b.rules, index, read_mol(b.f, "CC(C)(O)CC"),
                                &hooks, 0, &steps));
    assert_int_equal(steps.count, 0);
    check_ok(b.f, bs_rules_forth(&b.f->cx, &b.f->home, b.rules, index, &alkene, 1, &hooks, &sets));
    assert_int_equal(sets.count, 2);
    assert_true(sets.items[0].expected);
    assert_true(sets.items[0].score > sets.items[1].score);
    assert_int_equal(verdict_on(&b, &sets, "CC(C)C(C)O"), 1);
    assert_int_equal(verdict_on(&b, &sets, "CCC(C)(C)O"), 0);
    bs_rules_free(b.rules);
}

static bs_status use_book_once(fixture *f, const bs_mol *product, const bs_mol *const *given)
{
    bs_synthon_def acceptor = {
        .name = "a", .kind = BS_ACCEPTOR, .equivalents = carbonyl, .equivalent_count = 1};
    bs_synthon_def donor = {
        .name = "d", .kind = BS_DONOR, .equivalents = sodium, .equivalent_count = 1};
    bs_transform_def def = {.name = "cyanohydrin",
                            .target = "[CX4:1]([OX2H:3])-!@[C:2]#[N:4]",
                            .cut = {1, 2},
                            .acceptor_map = 1,
                            .donor_map = 2,
                            .acceptor = "a",
                            .donor = "d",
                            .hook_when = -1,
                            .hook_prefer = -1};
    bs_rules *rules = NULL;
    bs_steps steps = {0};
    bs_product_sets sets = {0};
    int index;
    bs_status st = bs_rules_new(&f->cx, &rules);

    if (st == BS_OK)
        st = bs_rules_add_synthon(&f->cx, rules, &acceptor);
    if (st == BS_OK)
        st = bs_rules_add_synthon(&f->cx, rules, &donor);
    if (st == BS_OK)
        st = bs_rules_add_transform(&f->cx, rules, &def, &index);
    if (st == BS_OK)
        st = bs_rules_back(&f->cx, &f->home, rules, -1, product, NULL, 0, &steps);
    if (st == BS_OK)
        st = bs_rules_forth(&f->cx, &f->home, rules, -1, given, 2, NULL, &sets);
    if (st == BS_OK && (steps.count != 1 || sets.count != 1))
        fail_msg("%d steps, %d sets", steps.count, sets.count);
    bs_rules_free(rules);
    return st;
}

static void book__every_failed_allocation_is_rolled_back(void **state)
{
    fixture *f = *state;
    const bs_mol *product = read_mol(f, "CC(C)(O)C#N");
    const bs_mol *given[] = {read_mol(f, "CC(C)=O"), read_mol(f, "[Na+].[C-]#N")};
    size_t live = f->home.live;
    bs_status st = BS_ENOMEM;

    for (long n = 0; n < 20000 && st == BS_ENOMEM; n++) {
        bs_mark mark = bs_arena_mark(&f->home);

        atomic_store(&f->cx.own_gate.fail_after, n);
        st = use_book_once(f, product, given);
        atomic_store(&f->cx.own_gate.fail_after, -1);
        bs_arena_rewind(&f->home, mark);
        assert_int_equal(f->home.live, live);
        assert_int_equal(f->cx.scratch.live, 0);
    }
    assert_int_equal(st, BS_OK);
}

/* Dehydration cannot be read backwards or forwards into a bridgehead alkene: Bredt's rule. */
static void back__makes_no_bridgehead_alkene(void **state)
{
    book b = new_book(state);
    int hydrogenation = add_from(&b, "hydrogenation", "[CX4:1][CX4;!H0:2]", "[C:1]=[C:2]");
    bs_steps steps = back(&b, hydrogenation, "C1CC2CCC1C2");

    assert_int_equal(steps.count, 1);
    assert_string_equal(steps.items[0].smiles[0], canonical(b.f, "C1=CC2CCC1C2"));
    steps = back(&b, hydrogenation, "C1CC2CCCC(C1)CCC2");
    assert_true(steps.count > 1);
    bs_rules_free(b.rules);
}

int main(void)
{
    const struct CMUnitTest tests[] = {
        check_case(ketone_reduction__takes_the_alcohol_back_to_the_ketone),
        check_case(ketone_reduction__leaves_the_new_centre_open),
        check_case(hydration__lists_the_other_regioisomer_as_rival),
        check_case(lindlar__makes_the_z_alkene_only),
        check_case(osmylation__makes_cis_diols_only),
        check_case(mitsunobu__turns_either_hand),
        check_case(cyanide__displaces_a_primary_halide),
        check_case(williamson__gives_ethers_from_both_sides),
        check_case(amide__comes_from_acid_chloride_and_amine),
        check_case(azole__is_alkylated_at_either_nitrogen),
        check_case(grignard__adds_to_a_carbonyl),
        check_case(reductive_amination__joins_ketone_and_amine),
        check_case(wittig__cuts_a_double_bond),
        check_case(aldol__counts_equal_halves),
        check_case(intramolecular_cut__leaves_one_molecule),
        check_case(names__ignore_case_spaces_and_hyphens),
        check_case(definitions__mistakes_name_the_field),
        check_case(synthons__mistakes_name_the_field),
        check_case(hooks__decide_and_order),
        check_case(back__makes_no_bridgehead_alkene),
        check_case(book__every_failed_allocation_is_rolled_back),
    };

    return cmocka_run_group_tests(tests, NULL, NULL);
}
