/*
 * Donor and acceptor labels against polarity.json: 48 difunctional compounds, labelled by Seebach's
 * rules (Angew. Chem. Int. Ed. Engl. 1979, 18, 239; from memory) by a script outside the project.
 */
#include "support/molecule.h"

#include <jansson.h>

#include "backsaw/polarity.h"

static int atom_with_label(const bs_mol *mol, int label)
{
    for (int i = 0; i < bs_mol_atom_count(mol); i++) {
        if (bs_mol_atom_label(mol, i) == label)
            return i;
    }
    fail_msg("no atom is labelled %d", label);
    return -1;
}

static void check_relation(fixture *f, const bs_mol *mol, const json_t *entry, const char *name)
{
    const json_t *paths = json_object_get(entry, "all_paths");
    const char *verdict = json_string_value(json_object_get(entry, "verdict"));
    bs_relation got;

    check_ok(f, bs_polarity_of_pair(&f->cx, &f->home, mol, atom_with_label(mol, 1),
                                    atom_with_label(mol, 2), &got));
    if (got.count != (int)json_array_size(paths))
        fail_msg("%s: %d chains, not %d", name, got.count, (int)json_array_size(paths));
    for (int i = 0; i < got.count; i++)
        assert_int_equal(got.lengths[i], json_integer_value(json_array_get(paths, (size_t)i)));
    assert_string_equal(got.dissonant ? "dissonant" : "consonant", verdict);
}

static void check_cut(fixture *f, const bs_mol *mol, const json_t *entry, const char *name)
{
    const json_t *cut = json_object_get(entry, "cut");
    const json_t *labels = json_object_get(entry, "labels");
    const json_t *umpolung = json_object_get(entry, "umpolung");
    size_t turned = 0;
    bs_polarity got;
    int maps[2];

    for (size_t i = 0; i < 2; i++)
        maps[i] = (int)json_integer_value(json_array_get(cut, i));
    check_ok(f, bs_polarity_of_bond(&f->cx, mol, atom_with_label(mol, maps[0]),
                                    atom_with_label(mol, maps[1]), &got));
    for (int i = 0; i < 2; i++) {
        char key[12], label[16];
        const char *expected;

        snprintf(key, sizeof key, "%d", maps[i]);
        expected = json_string_value(json_object_get(labels, key));
        bs_pole_label(&got.ends[i], label, sizeof label);
        if (strcmp(label, expected) != 0)
            fail_msg("%s: atom %s is %s, not %s", name, key, expected, label);
        if (got.ends[i].umpolung) {
            assert_string_equal(json_string_value(json_array_get(umpolung, turned)), label);
            turned++;
        }
    }
    assert_int_equal(turned, json_array_size(umpolung));
}

static void polarity__is_that_of_the_table(void **state)
{
    fixture *f = *state;
    json_t *all = json_load_file(BACKSAW_TEST_DATA "/checks/polarity.json", 0, NULL), *entry;
    size_t i;

    assert_non_null(all);
    assert_int_equal(json_array_size(json_object_get(all, "pairs")), 48);
    json_array_foreach(json_object_get(all, "pairs"), i, entry)
    {
        const char *name = json_string_value(json_object_get(entry, "name"));
        bs_mol *mol = molecule_read(f, json_string_value(json_object_get(entry, "smiles")));

        check_relation(f, mol, entry, name);
        if (json_is_array(json_object_get(entry, "cut")))
            check_cut(f, mol, entry, name);
    }
    json_decref(all);
}

/* A carbon far from any heteroatom has no nature; its partner's decides. */
static void polarity__of_an_alkyl_end_is_what_the_other_needs(void **state)
{
    fixture *f = *state;
    bs_mol *mol = molecule_read(f, "CCCCCCCCCCCC#N");
    bs_polarity got;
    char label[16];

    check_ok(f, bs_polarity_of_bond(&f->cx, mol, 10, 9, &got));
    assert_string_equal(bs_pole_label(&got.ends[0], label, sizeof label), "d2");
    assert_string_equal(bs_pole_label(&got.ends[1], label, sizeof label), "alkyl-a");
    assert_int_equal(got.relation, 0);
    assert_false(got.dissonant);
}

static void polarity__asks_for_a_bond_or_two_heteroatoms(void **state)
{
    fixture *f = *state;
    bs_mol *mol = molecule_read(f, "OCCC");
    bs_polarity bond;
    bs_relation pair;

    assert_int_equal(bs_polarity_of_bond(&f->cx, mol, 0, 2, &bond), BS_EVALUE);
    assert_string_equal(f->cx.error.message, "atoms 1 and 3 are not bonded");
    assert_int_equal(bs_polarity_of_bond(&f->cx, mol, 0, 4, &bond), BS_ERANGE);
    assert_string_equal(f->cx.error.message, "atom 5 is not there; the molecule has 4");
    assert_int_equal(bs_polarity_of_pair(&f->cx, &f->home, mol, 0, 3, &pair), BS_EVALUE);
    assert_string_equal(f->cx.error.message, "atom 4 is no heteroatom");
}

static void polarity__of_atoms_that_no_carbon_joins_is_none(void **state)
{
    fixture *f = *state;
    bs_relation pair;

    check_ok(f, bs_polarity_of_pair(&f->cx, &f->home, molecule_read(f, "OC.CN"), 0, 3, &pair));
    assert_int_equal(pair.count, 0);
}

int main(void)
{
    const struct CMUnitTest tests[] = {
        check_case(polarity__is_that_of_the_table),
        check_case(polarity__of_an_alkyl_end_is_what_the_other_needs),
        check_case(polarity__asks_for_a_bond_or_two_heteroatoms),
        check_case(polarity__of_atoms_that_no_carbon_joins_is_none),
    };

    return cmocka_run_group_tests(tests, NULL, NULL);
}
