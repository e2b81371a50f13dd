/* Drawings: what must hold for every one, and rules of good drawing that are common practice. */
#include "support/check.h"

#include <math.h>
#include <stdlib.h>
#include <string.h>

#include "backsaw/draft.h"
#include "backsaw/format.h"
#include "backsaw/layout.h"

static bs_mol *read_smiles(fixture *f, const char *text)
{
    bs_mol *mol;

    check_ok(f, bs_smiles_read(&f->cx, &f->home, text, strlen(text), NULL, &mol));
    return mol;
}

static bs_layout *draw(fixture *f, const char *text, bs_mol **mol)
{
    bs_layout *layout;

    *mol = read_smiles(f, text);
    check_ok(f, bs_layout_make(&f->cx, &f->home, *mol, &layout));
    return layout;
}

static double distance(bs_point a, bs_point b)
{
    return hypot(a.x - b.x, a.y - b.y);
}

static int wedge_count(const bs_layout *layout)
{
    int count = 0;

    for (int i = 0; i < layout->bond_count; i++)
        count += layout->bonds[i].wedge != BS_WEDGE_NONE;
    for (int i = 0; i < layout->hydrogen_count; i++)
        count += layout->hydrogens[i].wedge != BS_WEDGE_NONE;
    return count;
}

/* Bonds about 1 long, no two atoms in one place. */
static void check_places(const bs_mol *mol, const bs_layout *layout)
{
    for (int i = 0; i < bs_mol_bond_count(mol); i++) {
        int a, b;
        double length;

        bs_mol_bond_ends(mol, i, &a, &b);
        length = distance(layout->atoms[a], layout->atoms[b]);
        assert_true(length > 0.6 && length < 1.6);
    }
    for (int i = 0; i < layout->atom_count; i++) {
        for (int k = 0; k < i; k++)
            assert_true(distance(layout->atoms[i], layout->atoms[k]) > 0.2);
    }
}

static void layout__drug_molecules_are_evenly_drawn(void **state)
{
    fixture *f = *state;
    static const char *const smiles[] = {
        "CC(=O)Oc1ccccc1C(=O)O",
        "CN1CC[C@]23c4c5ccc(O)c4O[C@H]2[C@@H](O)C=C[C@H]3[C@H]1C5",
        "C[C@]12CC[C@H]3[C@H]([C@@H]1CC[C@@H]2O)CCC4=CC(=O)CC[C@]34C",
        "CC1(C)S[C@@H]2[C@H](NC(=O)Cc3ccccc3)C(=O)N2[C@H]1C(=O)O",
    };

    for (size_t i = 0; i < sizeof smiles / sizeof *smiles; i++) {
        bs_mol *mol;
        bs_layout *layout = draw(f, smiles[i], &mol);

        check_places(mol, layout);
        assert_int_equal(layout->lost, 0);
    }
}

/* One wedge for each centre: testosterone has six, all on hydrogens, methyl groups or OH. */
static void wedges__stand_outside_rings_and_one_for_each_centre(void **state)
{
    fixture *f = *state;
    bs_mol *mol;
    bs_layout *layout =
        draw(f, "C[C@]12CC[C@H]3[C@H]([C@@H]1CC[C@@H]2O)CCC4=CC(=O)CC[C@]34C", &mol);

    assert_int_equal(wedge_count(layout), 6);
    assert_int_equal(layout->hydrogen_count, 3);
    for (int i = 0; i < layout->bond_count; i++) {
        if (layout->bonds[i].wedge != BS_WEDGE_NONE)
            assert_false(bs_mol_bond_in_ring(mol, i));
    }
}

/* The narrow end is at the centre: alanine's only centre is atom 1. */
static void wedges__narrow_end_is_at_the_centre(void **state)
{
    fixture *f = *state;
    bs_mol *mol;
    bs_layout *layout = draw(f, "C[C@H](N)C(=O)O", &mol);
    int seen = 0;

    for (int i = 0; i < layout->bond_count; i++) {
        int a, b;

        if (layout->bonds[i].wedge == BS_WEDGE_NONE)
            continue;
        bs_mol_bond_ends(mol, i, &a, &b);
        assert_int_equal(layout->bonds[i].from_b ? b : a, 1);
        seen++;
    }
    assert_int_equal(seen, 1);
}

/* Mirror images are drawn alike with all wedges inverted. */
static void wedges__of_the_mirror_image_are_inverted(void **state)
{
    fixture *f = *state;
    bs_mol *mol;
    bs_layout *one = draw(f, "O[C@H](C)[C@@H](N)C(=O)O", &mol);
    bs_layout *other = draw(f, "O[C@@H](C)[C@H](N)C(=O)O", &mol);

    for (int i = 0; i < one->bond_count; i++) {
        assert_int_equal(one->bonds[i].wedge != 0, other->bonds[i].wedge != 0);
        if (one->bonds[i].wedge != BS_WEDGE_NONE)
            assert_int_not_equal(one->bonds[i].wedge, other->bonds[i].wedge);
    }
}

/* Inositol: six centres in a ring, each with its OH. */
static void wedges__are_found_where_all_neighbours_are_centres(void **state)
{
    fixture *f = *state;
    bs_mol *mol;
    bs_layout *layout = draw(f, "O[C@H]1[C@H](O)[C@@H](O)[C@H](O)[C@H](O)[C@@H]1O", &mol);

    assert_int_equal(layout->lost, 0);
    assert_int_equal(wedge_count(layout), 6);
}

static double side(const bs_layout *l, int a, int b, int point)
{
    return (l->atoms[b].x - l->atoms[a].x) * (l->atoms[point].y - l->atoms[a].y) -
           (l->atoms[b].y - l->atoms[a].y) * (l->atoms[point].x - l->atoms[a].x);
}

static void double_bonds__are_drawn_cis_and_trans(void **state)
{
    fixture *f = *state;
    static const struct {
        const char *smiles;
        bool trans;
    } cases[] = {{"F/C=C/Cl", true},
                 {"F/C=C\\Cl", false},
                 {"C1CCC/C=C/CC1", true},
                 {"C1CCC/C=C\\CC1", false}};

    for (size_t i = 0; i < sizeof cases / sizeof *cases; i++) {
        bs_mol *mol;
        bs_layout *layout = draw(f, cases[i].smiles, &mol);
        int from = i < 2 ? 0 : 3;

        assert_int_equal(layout->lost, 0);
        assert_int_equal(
            side(layout, from + 1, from + 2, from) * side(layout, from + 1, from + 2, from + 3) < 0,
            cases[i].trans);
    }
}

/* Crossed only where both ends have two different sides and the ring, if any, has eight atoms. */
static void double_bonds__are_undecided_only_where_it_matters(void **state)
{
    fixture *f = *state;
    static const struct {
        const char *smiles;
        bool undecided;
    } cases[] = {
        {"CC=CC", true},       {"CC(C)=CC", false}, {"C=CC", false},    {"C1CCCCC=C1", false},
        {"C1CCCCCC=C1", true}, {"C/C=C/C", false},  {"CC=C=CC", false}, {"CC=NO", true},
        {"CC=C=C=CC", true},   {"CC=N", false},
    };

    for (size_t i = 0; i < sizeof cases / sizeof *cases; i++) {
        bs_mol *mol;
        bs_layout *layout = draw(f, cases[i].smiles, &mol);
        bool undecided = false;

        for (int k = 0; k < layout->bond_count; k++)
            undecided |= layout->bonds[k].undecided;
        if (undecided != cases[i].undecided)
            fail_msg("%s", cases[i].smiles);
    }
}

/* The hydrogen of an imine is drawn where it tells the geometry. */
static void hydrogens__are_drawn_where_a_geometry_needs_them(void **state)
{
    fixture *f = *state;
    bs_mol *mol;
    bs_layout *layout = draw(f, "CC/C(C)=N/[H]", &mol);

    assert_int_equal(bs_mol_atom_count(mol), 5);
    assert_int_equal(layout->hydrogen_count, 1);
    assert_int_equal(bs_mol_atom_element(mol, layout->hydrogens[0].atom), 7);
    assert_int_equal(layout->lost, 0);
}

/* An octahedral centre has no place in a drawing with wedges. */
static void layout__tells_what_is_lost(void **state)
{
    fixture *f = *state;
    bs_mol *mol;
    bs_layout *layout = draw(f, "F[Co@OH12](Cl)(Br)(I)(C)N", &mol);

    assert_int_equal(layout->lost, 1);
}

static void layout__pieces_stand_apart(void **state)
{
    fixture *f = *state;
    bs_mol *mol;
    bs_layout *layout = draw(f, "[Na+].[Cl-].CCO.[K+]", &mol);

    for (int i = 0; i < layout->atom_count; i++) {
        for (int k = 0; k < i; k++) {
            if (bs_mol_bond_between(mol, i, k) < 0)
                assert_true(distance(layout->atoms[i], layout->atoms[k]) > 0.9);
        }
    }
    assert_true(layout->atoms[0].x < layout->atoms[1].x);
    assert_true(layout->atoms[1].x < layout->atoms[2].x);
    assert_true(layout->atoms[2].x < layout->atoms[5].x);
}

static void layout__of_nothing_is_empty(void **state)
{
    fixture *f = *state;
    bs_draft draft;
    bs_mol *mol;
    bs_layout *layout;

    bs_draft_init(&draft, &f->cx, &f->home);
    check_ok(f, bs_draft_finish(&draft, &f->home, NULL, &mol));
    check_ok(f, bs_layout_make(&f->cx, &f->home, mol, &layout));
    assert_int_equal(layout->atom_count, 0);
}

/* The same molecule gives the same bytes, whatever lies about in memory. */
static void layout__is_the_same_each_time(void **state)
{
    fixture *f = *state;
    static const char smiles[] = "C1(=O)CNC(=O)C2CCCCN2C(=O)CNC(=O)CNC(=O)C3=CC=CC(=C3)CC(=O)N1";
    bs_mol *mol;
    bs_layout *first = draw(f, smiles, &mol);

    for (int round = 0; round < 5; round++) {
        void *junk[200];
        bs_layout *again;

        for (int i = 0; i < 200; i++)
            junk[i] = malloc((size_t)(16 + (i * 37 + round * 101) % 400));
        for (int i = 0; i < 200; i += 2 + round % 2) {
            free(junk[i]);
            junk[i] = NULL;
        }
        check_ok(f, bs_layout_make(&f->cx, &f->home, mol, &again));
        assert_memory_equal(first->atoms, again->atoms,
                            (size_t)first->atom_count * sizeof *first->atoms);
        assert_memory_equal(first->bonds, again->bonds,
                            (size_t)first->bond_count * sizeof *first->bonds);
        for (int i = 0; i < 200; i++)
            free(junk[i]);
    }
}

/* Chains, rings, stars and ladders far beyond what coordgen can take, and all their stereo. */
static void layout__large_molecules_get_a_plain_drawing(void **state)
{
    fixture *f = *state;
    bs_text text;
    bs_mol *mol;
    bs_layout *layout;

    bs_text_init(&text, &f->cx);
    check_ok(f, bs_text_puts(&text, "C"));
    for (int i = 0; i < 300; i++)
        check_ok(f, bs_text_puts(&text, i % 3 ? "C[C@H](F)" : "/C=C/c1ccc(cc1)"));
    check_ok(f, bs_text_puts(&text, "C"));
    layout = draw(f, text.data, &mol);
    assert_int_equal(layout->lost, 0);
    assert_int_equal(wedge_count(layout), 200);
    bs_text_clear(&text);
    check_ok(f, bs_text_puts(&text, "C1"));
    for (int i = 0; i < 5000; i++)
        check_ok(f, bs_text_puts(&text, "C"));
    check_ok(f, bs_text_puts(&text, "1"));
    layout = draw(f, text.data, &mol);
    assert_true(distance(layout->atoms[0], layout->atoms[2500]) > 1000);
    bs_text_free(&text);
}

/* Adds a ring of carbon atoms, on the bond `edge` of the one before; `edge` becomes a bond of it.
 */
static void add_ring(fixture *f, bs_draft *draft, int size, uint32_t edge[2], bool fused)
{
    bs_draft_atom carbon = {.element = 6, .hydrogens = BS_DRAFT_IMPLIED};
    uint32_t first = 0;
    uint32_t last = 0;
    uint32_t middle[2] = {0, 0};

    for (int i = 0; i < size; i++) {
        uint32_t atom = fused && i == 0 ? edge[0] : fused && i == size - 1 ? edge[1] : 0;

        if (!fused || (i > 0 && i < size - 1))
            check_ok(f, bs_draft_add_atom(draft, carbon, &atom));
        if (i > 0)
            check_ok(f, bs_draft_add_bond(draft, last, atom, 1, NULL));
        if (i == 0)
            first = atom;
        if (i == size / 2 || i == size / 2 + 1)
            middle[i - size / 2] = atom;
        last = atom;
    }
    if (!fused)
        check_ok(f, bs_draft_add_bond(draft, last, first, 1, NULL));
    memcpy(edge, middle, sizeof middle);
}

/* Large rings that share bonds, a huge ring, a crowded tree: each would keep coordgen for minutes.
 */
static void layout__of_difficult_molecules_takes_seconds(void **state)
{
    fixture *f = *state;
    static const int rings[][2] = {{1, 48}, {5, 24}, {10, 10}, {1, 150}};
    bs_mol *mol;
    bs_layout *layout;

    for (size_t i = 0; i < sizeof rings / sizeof *rings; i++) {
        bs_draft draft;
        uint32_t edge[2] = {0, 0};

        bs_draft_init(&draft, &f->cx, &f->home);
        for (int r = 0; r < rings[i][0]; r++)
            add_ring(f, &draft, rings[i][1], edge, r > 0);
        check_ok(f, bs_draft_finish(&draft, &f->home, NULL, &mol));
        check_ok(f, bs_layout_make(&f->cx, &f->home, mol, &layout));
    }
    draw(f,
         "CC(C)(C)C(C(C)(C)C)(C(C)(C)C)C(C(C(C)(C)C)(C(C)(C)C)C(C)(C)C)(C(C(C)(C)C)(C(C)(C)C)C(C)("
         "C)C)"
         "C(C(C)(C)C)(C(C)(C)C)C(C)(C)C",
         &mol);
}

static void layout__gives_everything_back_when_memory_runs_out(void **state)
{
    fixture *f = *state;
    bs_mol *mol = read_smiles(f, "C[C@H](N)/C=C/CC=CC.[Na+]");
    bs_status st = BS_ENOMEM;
    long allowed;

    for (allowed = 0; st == BS_ENOMEM && allowed < 1000; allowed++) {
        size_t live = f->home.live;
        bs_layout *layout;

        atomic_store(&f->cx.own_gate.fail_after, allowed);
        st = bs_layout_make(&f->cx, &f->home, mol, &layout);
        atomic_store(&f->cx.own_gate.fail_after, -1);
        if (st != BS_OK) {
            assert_null(layout);
            assert_int_equal(f->home.live, live);
        }
    }
    assert_int_equal(st, BS_OK);
    check_requests(allowed, 2);
}

int main(void)
{
    const struct CMUnitTest tests[] = {
        check_case(layout__drug_molecules_are_evenly_drawn),
        check_case(wedges__stand_outside_rings_and_one_for_each_centre),
        check_case(wedges__narrow_end_is_at_the_centre),
        check_case(wedges__of_the_mirror_image_are_inverted),
        check_case(wedges__are_found_where_all_neighbours_are_centres),
        check_case(double_bonds__are_drawn_cis_and_trans),
        check_case(double_bonds__are_undecided_only_where_it_matters),
        check_case(hydrogens__are_drawn_where_a_geometry_needs_them),
        check_case(layout__tells_what_is_lost),
        check_case(layout__pieces_stand_apart),
        check_case(layout__of_nothing_is_empty),
        check_case(layout__is_the_same_each_time),
        check_case(layout__large_molecules_get_a_plain_drawing),
        check_case(layout__of_difficult_molecules_takes_seconds),
        check_case(layout__gives_everything_back_when_memory_runs_out),
    };

    return cmocka_run_group_tests_name("layout.layout", tests, NULL, NULL);
}
