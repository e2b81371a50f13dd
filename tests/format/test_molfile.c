/*
 * Molfiles written by hand after the description of the CTfile formats (from memory), with the
 * molecules that a chemist reads from them.
 */
#include "support/molecule.h"

#include <stdio.h>

#include "backsaw/file.h"

static const bs_record *read_text(fixture *f, const char *text, size_t length)
{
    bs_record *record;
    bs_status st = bs_molfile_read(&f->cx, &f->home, text, length, &record);

    if (st != BS_OK)
        fail_msg("%s", f->cx.error.message);
    return record;
}

static void check_reads(fixture *f, const char *text, const char *smiles)
{
    check_molecule(f, read_text(f, text, strlen(text))->mol, smiles);
}

static void check_refuses(fixture *f, const char *text, size_t length, bs_status status, long line,
                          const char *message)
{
    bs_record *record;
    size_t live = f->home.live;

    assert_int_equal(bs_molfile_read(&f->cx, &f->home, text, length, &record), status);
    assert_null(record);
    assert_string_equal(f->cx.error.message, message);
    assert_int_equal(f->cx.error.line, line);
    assert_int_equal(f->home.live, live);
}

/*
 * Alanine with the amino group at the top, the acid at the lower right, the methyl group at the
 * lower left. With the amino group hashed the hydrogen points at the viewer; N, COOH, CH3 run
 * clockwise on the page, so seen from the other side anticlockwise: S, which is L.
 */
#define ALANINE(mark)                                                                              \
    "L-alanine\n"                                                                                  \
    "  by hand           2D\n"                                                                     \
    "a comment\n"                                                                                  \
    "  6  5  0  0  1  0  0  0  0  0999 V2000\n"                                                    \
    "    0.0000    0.0000    0.0000 C   0  0  0  0  0  0  0  0  0  0  0  0\n"                      \
    "   -0.8660   -0.5000    0.0000 C   0  0\n"                                                    \
    "    0.0000    1.0000    0.0000 N   0  0\n"                                                    \
    "    0.8660   -0.5000    0.0000 C   0  0\n"                                                    \
    "    1.7321    0.0000    0.0000 O   0  0\n"                                                    \
    "    0.8660   -1.5000    0.0000 O   0  0\n"                                                    \
    "  1  2  1  0  0  0  0\n"                                                                      \
    "  1  3  1  " mark "\n"                                                                        \
    "  1  4  1  0\n"                                                                               \
    "  4  5  2  0\n"                                                                               \
    "  4  6  1  0\n"                                                                               \
    "M  END\n"

static void v2000__alanine_by_its_wedge(void **state)
{
    fixture *f = *state;
    const bs_record *record;
    char *key;

    record = read_text(f, ALANINE("6"), strlen(ALANINE("6")));
    check_molecule(f, record->mol, "C[C@H](N)C(=O)O");
    assert_string_equal(record->name, "L-alanine");
    assert_true(record->chiral);
    /* The InChIKey of L-alanine as chemical dictionaries give it. */
    check_ok(f, bs_inchi(&f->cx, &f->home, record->mol, true, &key));
    assert_string_equal(key, "QNAYBMKLOCPYGJ-REOHCLBHSA-N");
    check_reads(f, ALANINE("1"), "C[C@@H](N)C(=O)O");
    check_reads(f, ALANINE("4"), "CC(N)C(=O)O");
    check_reads(f, ALANINE("0"), "CC(N)C(=O)O");
}

static void v3000__alanine_with_a_line_that_goes_on(void **state)
{
    fixture *f = *state;
    const bs_record *record;
    static const char text[] = "L-alanine\n"
                               "\n"
                               "\n"
                               "  0  0  0     0  0            999 V3000\n"
                               "M  V30 BEGIN CTAB\n"
                               "M  V30 COUNTS 6 5 0 0 1\n"
                               "M  V30 BEGIN ATOM\n"
                               "M  V30 10 C 0 0 0 0 CFG=2\n"
                               "M  V30 20 C -0.866 -0.5 0 0\n"
                               "M  V30 30 N 0 1 -\n"
                               "M  V30 0 0\n"
                               "M  V30 40 C 0.866 -0.5 0 0\n"
                               "M  V30 50 O 1.7321 0 0 0\n"
                               "M  V30 60 O 0.866 -1.5 0 0\n"
                               "M  V30 END ATOM\n"
                               "M  V30 BEGIN BOND\n"
                               "M  V30 1 1 10 20\n"
                               "M  V30 2 1 10 30 CFG=3\n"
                               "M  V30 3 1 10 40\n"
                               "M  V30 4 2 40 50\n"
                               "M  V30 5 1 40 60\n"
                               "M  V30 END BOND\n"
                               "M  V30 BEGIN COLLECTION\n"
                               "M  V30 MDLV30/STERAC2 ATOMS=(1 10)\n"
                               "M  V30 MDLV30/HILITE ATOMS=(1 20)\n"
                               "M  V30 END COLLECTION\n"
                               "M  V30 END CTAB\n"
                               "M  END\n";

    record = read_text(f, text, sizeof text - 1);
    check_molecule(f, record->mol, "C[C@H](N)C(=O)O");
    assert_int_equal(record->group_count, 1);
    assert_int_equal(record->groups[0].kind, BS_STEREO_GROUP_RACEMIC);
    assert_int_equal(record->groups[0].number, 2);
    assert_int_equal(record->groups[0].atom_count, 1);
    assert_int_equal(record->groups[0].atoms[0], 0);
}

/* The hydrogen of the centre drawn, on a wedge: the amino group of L-alanine points away. */
static void v2000__alanine_by_the_wedge_of_a_hydrogen(void **state)
{
    fixture *f = *state;
    static const char text[] = "\n\n\n  7  6  0  0  0  0  0  0  0  0999 V2000\n"
                               "    0.0000    0.0000    0.0000 C   0  0\n"
                               "   -0.8660   -0.5000    0.0000 C   0  0\n"
                               "   -0.5000    0.8660    0.0000 N   0  0\n"
                               "    0.8660   -0.5000    0.0000 C   0  0\n"
                               "    1.7321    0.0000    0.0000 O   0  0\n"
                               "    0.8660   -1.5000    0.0000 O   0  0\n"
                               "    0.5000    0.8660    0.0000 H   0  0\n"
                               "  1  2  1  0\n  1  3  1  0\n  1  4  1  0\n  4  5  2  0\n"
                               "  4  6  1  0\n  1  7  1  1\nM  END\n";
    const bs_record *record = read_text(f, text, sizeof text - 1);

    check_molecule(f, record->mol, "C[C@H](N)C(=O)O");
    assert_int_equal(bs_mol_atom_count(record->mol), 6);
}

/* CHFClBr in space: seen against the hydrogen, F, Cl, Br run anticlockwise. */
static void v2000__centre_by_places_in_space(void **state)
{
    fixture *f = *state;

    check_reads(f,
                "\n  by hand           3D\n\n  5  4  0  0  0  0  0  0  0  0999 V2000\n"
                "    0.0000    0.0000    0.0000 C   0  0\n"
                "    0.0000    0.0000   -1.0000 H   0  0\n"
                "    1.0000    0.0000    0.3000 F   0  0\n"
                "   -0.5000    0.8700    0.3000 Cl  0  0\n"
                "   -0.5000   -0.8700    0.3000 Br  0  0\n"
                "  1  2  1  0\n  1  3  1  0\n  1  4  1  0\n  1  5  1  0\nM  END\n",
                "[H][C@@](F)(Cl)Br");
}

/*
 * Parity 1: with the hydrogen behind, the others in the order of their numbers run clockwise.
 * Written as SMILES from the hydrogen, anticlockwise.
 */
static void v2000__centre_by_parity_without_places(void **state)
{
    fixture *f = *state;

    check_reads(f,
                "\n\n\n  4  3  0  0  0  0  0  0  0  0999 V2000\n"
                "    0.0000    0.0000    0.0000 C   0  0  1\n"
                "    0.0000    0.0000    0.0000 F   0  0  0\n"
                "    0.0000    0.0000    0.0000 Cl  0  0  0\n"
                "    0.0000    0.0000    0.0000 Br  0  0  0\n"
                "  1  2  1  0\n  1  3  1  0\n  1  4  1  0\nM  END\n",
                "[H][C@](F)(Cl)Br");
}

#define BUTENE(x, y, mark)                                                                         \
    "\n\n\n  4  3  0  0  0  0  0  0  0  0999 V2000\n"                                              \
    "   -0.5000    0.8660    0.0000 C   0  0\n"                                                    \
    "    0.0000    0.0000    0.0000 C   0  0\n"                                                    \
    "    1.0000    0.0000    0.0000 C   0  0\n" x y "    0.0000 C   0  0\n"                        \
    "  1  2  1  0\n  2  3  2  " mark "\n  3  4  1  0\nM  END\n"

static void v2000__double_bond_by_places(void **state)
{
    fixture *f = *state;

    check_reads(f, BUTENE("    1.5000", "    0.8660", "0"), "C/C=C\\C");
    check_reads(f, BUTENE("    1.5000", "   -0.8660", "0"), "C/C=C/C");
    check_reads(f, BUTENE("    1.5000", "   -0.8660", "3"), "CC=CC");
    /* On the line of the bond, the drawing says nothing. */
    check_reads(f, BUTENE("    2.0000", "    0.0000", "0"), "CC=CC");
}

static void v2000__charges_isotopes_radicals_and_valences(void **state)
{
    fixture *f = *state;

    /* Charge codes of the atom block: 3 is +1, 5 is -1. */
    check_reads(f,
                "\n\n\n  2  0  0  0  0  0  0  0  0  0999 V2000\n"
                "    0.0000    0.0000    0.0000 Na  0  3\n"
                "    2.0000    0.0000    0.0000 Cl  0  5\nM  END\n",
                "[Na+].[Cl-]");
    /* M  CHG takes the place of all of them; the hydrogens follow the charge. */
    check_reads(f,
                "\n\n\n  2  0  0  0  0  0  0  0  0  0999 V2000\n"
                "    0.0000    0.0000    0.0000 N   0  5\n"
                "    2.0000    0.0000    0.0000 O   0  3\nM  CHG  2   1   1   2  -1\nM  END\n",
                "[NH4+].[OH-]");
    /* Mass difference +1 of carbon, M  ISO, and D. */
    check_reads(f,
                "\n\n\n  1  0  0  0  0  0  0  0  0  0999 V2000\n"
                "    0.0000    0.0000    0.0000 C   1  0\nM  END\n",
                "[13CH4]");
    check_reads(f,
                "\n\n\n  3  2  0  0  0  0  0  0  0  0999 V2000\n"
                "    0.0000    0.0000    0.0000 C   0  0\n"
                "    1.0000    0.0000    0.0000 O   0  0\n"
                "    2.0000    0.0000    0.0000 D   0  0\n"
                "  1  2  1  0\n  2  3  1  0\nM  ISO  2   1  14   2  18\nM  END\n",
                "[14CH3][18O][2H]");
    /* Methyl radical, methylene, TEMPO's group. */
    check_reads(f,
                "\n\n\n  2  0  0  0  0  0  0  0  0  0999 V2000\n"
                "    0.0000    0.0000    0.0000 C   0  0\n"
                "    2.0000    0.0000    0.0000 C   0  0\nM  RAD  2   1   2   2   1\nM  END\n",
                "[CH3].[CH2]");
    /* A stated valence: SnH2 with two methyl groups is SnMe2 here; 15 is none at all. */
    check_reads(f,
                "\n\n\n  4  2  0  0  0  0  0  0  0  0999 V2000\n"
                "    0.0000    0.0000    0.0000 C   0  0\n"
                "    1.0000    0.0000    0.0000 Sn  0  0  0  0  0  2\n"
                "    2.0000    0.0000    0.0000 C   0  0\n"
                "    4.0000    0.0000    0.0000 C   0  0  0  0  0 15\n"
                "  1  2  1  0\n  2  3  1  0\nM  END\n",
                "C[Sn]C.[C]");
    /* Metals carry no hydrogens of their own. */
    check_reads(f,
                "\n\n\n  3  1  0  0  0  0  0  0  0  0999 V2000\n"
                "    0.0000    0.0000    0.0000 Na  0  0\n"
                "    1.0000    0.0000    0.0000 Mg  0  0\n"
                "    2.0000    0.0000    0.0000 C   0  0\n  2  3  1  0\nM  END\n",
                "[Na].C[Mg]");
}

static void v2000__groups_mappings_and_odd_symbols(void **state)
{
    fixture *f = *state;

    check_reads(f,
                "\n\n\n  4  3  0  0  0  0  0  0  0  0999 V2000\n"
                "    0.0000    0.0000    0.0000 R#  0  0\n"
                "    1.0000    0.0000    0.0000 C   0  0  0  0  0  0  0  0  0  7  0  0\n"
                "    2.0000    0.0000    0.0000 *   0  0\n"
                "    1.0000    1.0000    0.0000 CL  0  0\n"
                "  1  2  1  0\n  2  3  1  0\n  2  4  1  0\nM  RGP  1   1   2\nM  END\n",
                "[*:2][CH:7](*)Cl");
}

/* Pyridine and pyrrole with aromatic bonds; pyrrole's hydrogen is stated. */
static void v2000__aromatic_bonds_get_their_orders(void **state)
{
    fixture *f = *state;

    check_reads(
        f,
        "\n\n\n  6  6  0  0  0  0  0  0  0  0999 V2000\n"
        "    0.0000    1.0000    0.0000 N   0  0\n    0.8660    0.5000    0.0000 C   0  0\n"
        "    0.8660   -0.5000    0.0000 C   0  0\n    0.0000   -1.0000    0.0000 C   0  0\n"
        "   -0.8660   -0.5000    0.0000 C   0  0\n   -0.8660    0.5000    0.0000 C   0  0\n"
        "  1  2  4  0\n  2  3  4  0\n  3  4  4  0\n  4  5  4  0\n  5  6  4  0\n  6  1  4  0\n"
        "M  END\n",
        "c1ccncc1");
    check_reads(f,
                "\n\n\n  5  5  0  0  0  0  0  0  0  0999 V2000\n"
                "    0.0000    1.0000    0.0000 N   0  0  0  2\n"
                "    0.9511    0.3090    0.0000 C   0  0\n    0.5878   -0.8090    0.0000 C   0  0\n"
                "   -0.5878   -0.8090    0.0000 C   0  0\n   -0.9511    0.3090    0.0000 C   0  0\n"
                "  1  2  4  0\n  2  3  4  0\n  3  4  4  0\n  4  5  4  0\n  5  1  4  0\nM  END\n",
                "c1cc[nH]c1");
}

/* A coordinate bond (type 9) does not count for the valence; a hydrogen bond (10) is no bond. */
static void v3000__coordinate_and_hydrogen_bonds(void **state)
{
    fixture *f = *state;
    static const char text[] = "\n\n\n  0  0  0     0  0            999 V3000\n"
                               "M  V30 BEGIN CTAB\nM  V30 COUNTS 3 2 0 0 0\nM  V30 BEGIN ATOM\n"
                               "M  V30 1 N 0 0 0 0\nM  V30 2 B 1 0 0 0\nM  V30 3 O 3 0 0 0\n"
                               "M  V30 END ATOM\nM  V30 BEGIN BOND\nM  V30 1 9 1 2\n"
                               "M  V30 2 10 2 3\nM  V30 END BOND\nM  V30 END CTAB\nM  END\n";
    const bs_record *record = read_text(f, text, sizeof text - 1);

    assert_int_equal(bs_mol_bond_count(record->mol), 1);
    assert_int_equal(bs_mol_bond_order(record->mol, 0), 0);
    assert_int_equal(bs_mol_atom_hydrogens(record->mol, 0), 3);
    assert_int_equal(bs_mol_atom_hydrogens(record->mol, 1), 3);
    assert_int_equal(bs_mol_atom_hydrogens(record->mol, 2), 2);
}

/* An allene with its hand on a wedge, and the mirror image of the picture. */
static void v2000__allene_by_a_wedge(void **state)
{
    fixture *f = *state;
    static const char format[] =
        "\n\n\n  5  4  0  0  0  0  0  0  0  0999 V2000\n"
        "   -1.5000    0.8660    0.0000 F   0  0\n"
        "   -1.0000    0.0000    0.0000 C   0  0\n"
        "    0.0000    0.0000    0.0000 C   0  0\n"
        "    1.0000    0.0000    0.0000 C   0  0\n"
        "    1.5000    0.8660    0.0000 Cl  0  0\n"
        "  1  2  1  0\n  2  3  2  0\n  3  4  2  0\n  4  5  1  %c\nM  END\n";
    char up[1000];
    char down[1000];

    snprintf(up, sizeof up, format, '1');
    snprintf(down, sizeof down, format, '6');
    /*
     * F above, H below on the left; Cl in front, H behind on the right. A viewer at F with the
     * front side of the page to the top sees H of the left end at the right, H of the right end at
     * the lower left, Cl at the upper left. FC([H])=C=C([H])Cl lists them so: clockwise.
     */
    check_reads(f, up, "FC([H])=[C@@]=C([H])Cl");
    check_reads(f, down, "FC([H])=[C@]=C([H])Cl");
}

static void v2000__files_of_other_programs(void **state)
{
    fixture *f = *state;

    /* CRLF, no version and no M  END, as in old files. */
    check_reads(f, "water\r\n\r\n\r\n  1  0\r\n    0.0000    0.0000    0.0000 O   0  0\r\n", "O");
    /* Aliases, group abbreviations, S groups, and lines to skip. */
    check_reads(f,
                "\n\n\n  1  0  0  0  0  0  0  0  0  0999 V2000\n"
                "    0.0000    0.0000    0.0000 O   0  0\nA    1\nwater\nM  STY  1   1 DAT\n"
                "V    1 text\nS  SKP  2\nfirst\nsecond\n\nM  END\n",
                "O");
}

/* ---- Refused ------------------------------------------------------------------------------- */

#define ONE_ATOM(counts, symbol, rest)                                                             \
    "\n\n\n" counts "  0  0  0  0  0  0  0  0999 V2000\n"                                          \
    "    0.0000    0.0000    0.0000 " symbol "  0  0\n" rest

static void molfile__errors_name_line_and_column(void **state)
{
    fixture *f = *state;
    static const struct {
        const char *text;
        bs_status status;
        long line;
        const char *message;
    } cases[] = {
        {"", BS_ESYNTAX, 1, "line 1: the record ends; the name of a molecule was expected"},
        {"a\nb\nc\n", BS_ESYNTAX, 4, "line 4: the record ends; the counts line was expected"},
        {"$RXN\n", BS_EVALUE, 1,
         "line 1, columns 1 to 4: this is a reaction; a molecule was expected"},
        {"\n\n\n  1  x  0  0  0  0  0  0  0  0999 V2000\n", BS_ESYNTAX, 4,
         "line 4, columns 4 to 6: 'x' stands where the number of bonds (0 to 999) was expected"},
        {"\n\n\n  1  0  0  0  0  0  0  0  0  0999 V4000\n", BS_ESYNTAX, 4,
         "line 4, columns 35 to 39: 'V4000' is no version of the molfile format; V2000 or V3000 "
         "was "
         "expected"},
        {ONE_ATOM("  1  0", "Xx ", "M  END\n"), BS_EVALUE, 5,
         "line 5, columns 32 to 34: 'Xx' is no element; a symbol such as C or Cl was expected"},
        {ONE_ATOM("  1  0", "L  ", "M  END\n"), BS_EVALUE, 5,
         "line 5, columns 32 to 34: 'L' is a list of elements; a molecule has one element at each "
         "place"},
        {ONE_ATOM("  1  0", "Q  ", "M  END\n"), BS_EVALUE, 5,
         "line 5, columns 32 to 34: 'Q' is a query atom; a molecule has one element at each place"},
        {ONE_ATOM("  2  0", "C  ", "M  END\n"), BS_ESYNTAX, 6,
         "line 6: an atom line was expected: x, y and z in columns 1 to 30, the symbol in 32 to "
         "34"},
        {ONE_ATOM("  1  1", "C  ", "  1  2  1  0\nM  END\n"), BS_ESYNTAX, 6,
         "line 6, columns 4 to 6: '2' stands where an atom number (1 to 1) was expected"},
        {ONE_ATOM("  1  1", "C  ", "  1  1  1  0\nM  END\n"), BS_EVALUE, 6,
         "line 6, columns 1 to 6: atom 1 is bonded to itself"},
        {ONE_ATOM("  1  0", "C  ", "  1  1  1  0\nM  END\n"), BS_ESYNTAX, 6,
         "line 6: a property line or M  END was expected; the counts of atoms and bonds may be "
         "wrong"},
        {ONE_ATOM("  1  0", "C  ", "M  CHG  2   1   1\nM  END\n"), BS_ESYNTAX, 6,
         "line 6, columns 7 to 9: 2 entries are announced, the line has 1"},
        {ONE_ATOM("  1  0", "C  ", "M  CHG  1   2   1\nM  END\n"), BS_ESYNTAX, 6,
         "line 6, columns 10 to 13: '2' stands where an atom number (1 to 1) was expected"},
        {ONE_ATOM("  1  0", "C  ", "M  CHG  1   1  99\nM  END\n"), BS_ESYNTAX, 6,
         "line 6, columns 14 to 17: '99' stands where a charge (-15 to 15) was expected"},
        {ONE_ATOM("  1  0", "C  ", "M  ALS   1  2 F C   N\nM  END\n"), BS_EVALUE, 6,
         "line 6, columns 1 to 6: a list of elements; a molecule has one element at each place"},
        {ONE_ATOM("  1  0", "C  ", "M  STY  1   1 DAT\n"), BS_ESYNTAX, 7,
         "line 7: the record ends; M  END was expected"},
        {"\n\n\n  1  0  0  0  0  0  0  0  0  0999 V2000\n    0.00e0    1e9999    0.0000 C   0  0\n",
         BS_ESYNTAX, 5,
         "line 5, columns 11 to 20: '1e9999' stands where a coordinate such as 1.2500 was "
         "expected"},
        {"\n\n\n  2  1  0  0  0  0  0  0  0  0999 V2000\n"
         "    0.0000    0.0000    0.0000 C   0  0\n    1.0000    0.0000    0.0000 C   0  0\n"
         "  1  2  8  0\nM  END\n",
         BS_EVALUE, 7,
         "line 7, columns 7 to 9: bond type 8 belongs to a query; a molecule has types 1 to 4"},
        {"\n\n\n  2  2  0  0  0  0  0  0  0  0999 V2000\n"
         "    0.0000    0.0000    0.0000 C   0  0\n    1.0000    0.0000    0.0000 C   0  0\n"
         "  1  2  1  0\n  2  1  1  0\nM  END\n",
         BS_EVALUE, 6, "line 6: two bonds between the same two atoms"},
    };

    for (size_t i = 0; i < sizeof cases / sizeof *cases; i++)
        check_refuses(f, cases[i].text, strlen(cases[i].text), cases[i].status, cases[i].line,
                      cases[i].message);
}

#define V3000(counts, atoms, rest)                                                                 \
    "\n\n\n  0  0  0     0  0            999 V3000\nM  V30 BEGIN CTAB\nM  V30 COUNTS " counts      \
    " 0 0 0\nM  V30 BEGIN ATOM\n" atoms "M  V30 END ATOM\n" rest

static void v3000__errors_name_line_and_word(void **state)
{
    fixture *f = *state;
    static const struct {
        const char *text;
        bs_status status;
        long line;
        const char *message;
    } cases[] = {
        {"\n\n\n  0  0  0     0  0            999 V3000\nM  V30 BEGIN CTAB\n", BS_ESYNTAX, 6,
         "line 6: the record ends; a line that starts with 'M  V30' was expected"},
        {V3000("900000000 1", "", ""), BS_ESYNTAX, 6,
         "line 6, columns 15 to 23: '900000000' stands where the number of atoms was expected"},
        {V3000("9000000 1", "", ""), BS_ESYNTAX, 6,
         "line 6: 9000000 atoms and 1 bonds are announced; the record is too short for them"},
        {V3000("1 0", "M  V30 1 C 0 0\n", ""), BS_ESYNTAX, 8,
         "line 8: the line ends where a coordinate such as 1.25 was expected"},
        {V3000("1 0", "M  V30 1 [C,N] 0 0 0 0\n", ""), BS_EVALUE, 8,
         "line 8: a list of elements; a molecule has one element at each place"},
        {V3000("1 0", "M  V30 1 C 0 0 0 0 CHG=x\n", ""), BS_ESYNTAX, 8,
         "line 8, column 24: 'x' stands where a charge (-15 to 15) was expected"},
        {V3000("2 0", "M  V30 1 C 0 0 0 0\nM  V30 1 C 0 0 0 0\n", ""), BS_EVALUE, 9,
         "line 9, column 8: '1' stands where an atom number of its own was expected"},
        {V3000("1 1", "M  V30 1 C 0 0 0 0\n",
               "M  V30 BEGIN BOND\nM  V30 1 1 1 7\nM  V30 END BOND\nM  V30 END CTAB\n"),
         BS_EVALUE, 11, "line 11, column 14: '7' stands where the number of an atom was expected"},
        {V3000("2 1", "M  V30 1 C 0 0 0 0\nM  V30 2 C 0 0 0 0\n", "M  V30 END CTAB\nM  END\n"),
         BS_ESYNTAX, 11, "line 11: the table ends without its bonds"},
    };

    for (size_t i = 0; i < sizeof cases / sizeof *cases; i++)
        check_refuses(f, cases[i].text, strlen(cases[i].text), cases[i].status, cases[i].line,
                      cases[i].message);
}

/* NUL bytes and other rubbish in every place of a good file: an error or a molecule, no more. */
static void molfile__rubbish_at_any_place_does_no_harm(void **state)
{
    fixture *f = *state;
    static const char text[] = ALANINE("6");
    static const char rubbish[] = {'\0', '\n', '9', '-', ' ', '\xff', 'M', '('};
    char spoilt[sizeof text];
    bs_record *record;

    for (size_t i = 0; i < sizeof text - 1; i++) {
        for (size_t k = 0; k < sizeof rubbish; k++) {
            bs_mark kept = bs_arena_mark(&f->home);

            memcpy(spoilt, text, sizeof text);
            spoilt[i] = rubbish[k];
            (void)bs_molfile_read(&f->cx, &f->home, spoilt, sizeof text - 1, &record);
            bs_arena_rewind(&f->home, kept);
        }
        /* Cut in two. */
        if (i + 8 < sizeof text - 1) {
            memcpy(spoilt, text, i);
            assert_int_not_equal(bs_molfile_read(&f->cx, &f->home, spoilt, i, &record), BS_OK);
        }
    }
}

static void molfile__gives_everything_back_when_memory_runs_out(void **state)
{
    fixture *f = *state;
    static const char text[] = ALANINE("6");
    bs_status st = BS_ENOMEM;
    bs_record *record;

    for (long allowed = 0; st == BS_ENOMEM && allowed < 1000; allowed++) {
        size_t live = f->home.live;

        atomic_store(&f->cx.own_gate.fail_after, allowed);
        st = bs_molfile_read(&f->cx, &f->home, text, sizeof text - 1, &record);
        atomic_store(&f->cx.own_gate.fail_after, -1);
        if (st != BS_OK)
            assert_int_equal(f->home.live, live);
    }
    assert_int_equal(st, BS_OK);
}

/* ---- Written ------------------------------------------------------------------------------- */

static void write__version_is_chosen_or_refused(void **state)
{
    fixture *f = *state;
    bs_text smiles;
    bs_text out;
    const bs_mol *mol;

    bs_text_init(&smiles, &f->cx);
    bs_text_init(&out, &f->cx);
    for (int i = 0; i < 1000; i++)
        check_ok(f, bs_text_puts(&smiles, i ? ".[He]" : "[He]"));
    mol = molecule_read(f, smiles.data);
    check_ok(f, bs_molfile_write(&out, mol, "helium", BS_MOLFILE_AUTO, NULL));
    assert_non_null(strstr(out.data, "V3000\nM  V30 BEGIN CTAB\nM  V30 COUNTS 1000 0 0 0 0\n"));
    bs_text_clear(&out);
    assert_int_equal(bs_molfile_write(&out, mol, NULL, BS_MOLFILE_V2000, NULL), BS_EVALUE);
    assert_string_equal(f->cx.error.message, "V2000 cannot hold more than 999 atoms; V3000 can");
    assert_int_equal(out.length, 0);
    mol = molecule_read(f, "C$C");
    assert_int_equal(bs_molfile_write(&out, mol, NULL, BS_MOLFILE_AUTO, NULL), BS_EVALUE);
    assert_string_equal(f->cx.error.message,
                        "a molfile has no code for the quadruple bond between atoms 1 and 2");
    bs_text_free(&smiles);
    bs_text_free(&out);
}

/* Columns and property lines as the description of the format has them. */
static void write__property_lines_hold_eight_entries(void **state)
{
    fixture *f = *state;
    bs_text out;

    bs_text_init(&out, &f->cx);
    check_ok(f, bs_molfile_write(&out,
                                 molecule_read(f, "[K+].[K+].[K+].[K+].[K+].[K+].[K+].[K+].[K+]"
                                                  ".[13CH4].[*:3].[Na].[CH3]"),
                                 "two\nlines", BS_MOLFILE_V2000, NULL));
    assert_memory_equal(out.data, "two lines\n", 10);
    assert_non_null(strstr(out.data, "\n 13  0  0  0  0  0  0  0  0  0999 V2000\n"));
    assert_non_null(strstr(out.data, "M  CHG  8   1   1   2   1   3   1   4   1   5   1   6   1   "
                                     "7   1   8   1\nM  CHG  1   9   1\n"));
    assert_non_null(strstr(out.data, "M  ISO  1  10  13\n"));
    assert_non_null(strstr(out.data, "M  RGP  1  11   3\n"));
    assert_non_null(strstr(out.data, "M  RAD  1  13   2\n"));
    assert_non_null(strstr(out.data, " Na  0  0  0  0  0 15  0  0  0  0  0  0\n"));
    assert_non_null(strstr(out.data, " C   0  0  0  0  0  3  0  0  0  0  0  0\n"));
    bs_text_free(&out);
}

int main(void)
{
    const struct CMUnitTest tests[] = {
        check_case(v2000__alanine_by_its_wedge),
        check_case(v3000__alanine_with_a_line_that_goes_on),
        check_case(v2000__alanine_by_the_wedge_of_a_hydrogen),
        check_case(v2000__centre_by_places_in_space),
        check_case(v2000__centre_by_parity_without_places),
        check_case(v2000__double_bond_by_places),
        check_case(v2000__charges_isotopes_radicals_and_valences),
        check_case(v2000__groups_mappings_and_odd_symbols),
        check_case(v2000__aromatic_bonds_get_their_orders),
        check_case(v3000__coordinate_and_hydrogen_bonds),
        check_case(v2000__allene_by_a_wedge),
        check_case(v2000__files_of_other_programs),
        check_case(molfile__errors_name_line_and_column),
        check_case(v3000__errors_name_line_and_word),
        check_case(molfile__rubbish_at_any_place_does_no_harm),
        check_case(molfile__gives_everything_back_when_memory_runs_out),
        check_case(write__version_is_chosen_or_refused),
        check_case(write__property_lines_hold_eight_entries),
    };

    return cmocka_run_group_tests_name("format.molfile", tests, NULL, NULL);
}
