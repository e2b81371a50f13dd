/* The shelf: sources in order, what is free, prices per mole. */
#include "catalogue/folder.h"

#include "backsaw/catalogue.h"
#include "backsaw/format.h"

#include <math.h>

static bs_mol *read_mol(folder *d, const char *smiles)
{
    bs_mol *mol;

    check_ok(d->f, bs_smiles_read(&d->f->cx, &d->f->home, smiles, strlen(smiles), NULL, &mol));
    return mol;
}

static bs_shelf *new_shelf(folder *d)
{
    bs_shelf *shelf;

    check_ok(d->f, bs_shelf_new(&d->f->cx, &shelf));
    return shelf;
}

static bs_catalogue *open_list(folder *d, const char *file, const char *text)
{
    const char *input = folder_puts(d, file, text), *output;
    bs_import_report report;
    bs_catalogue *catalogue;
    char name[100];

    snprintf(name, sizeof name, "%s.catalogue", file);
    output = folder_name(d, name);
    check_ok(d->f, bs_catalogue_build(&d->f->cx, &input, 1, output, &report));
    check_ok(d->f, bs_catalogue_open(&d->f->cx, output, &catalogue));
    return catalogue;
}

static void put(folder *d, bs_shelf *shelf, int list, const char *smiles, double per_mole)
{
    check_ok(d->f, bs_shelf_put(&d->f->cx, shelf, list, read_mol(d, smiles), per_mole));
}

/* The price, or -1 if the molecule cannot be had. */
static double price(folder *d, bs_shelf *shelf, const char *smiles, bs_offer *offer)
{
    bs_mol *mol = read_mol(d, smiles);
    char *canonical;
    double per_mole;
    bool found;

    check_ok(d->f, bs_smiles_canonical(&d->f->cx, &d->f->home, mol, 0, &canonical));
    check_ok(d->f, bs_shelf_price(&d->f->cx, &d->f->home, shelf, mol, canonical, &found, &per_mole,
                                  offer));
    return found ? per_mole : -1;
}

static void check_price(folder *d, bs_shelf *shelf, const char *smiles, double want)
{
    double got = price(d, shelf, smiles, NULL);

    if (fabs(got - want) > 1e-9 * (1 + fabs(want)))
        fail_msg("%s costs %.12g, not %.12g", smiles, got, want);
}

static void shelf__empty_has_what_holds_no_carbon(void **state)
{
    static const char *const at_hand[] = { "O", "N", "[H][H]", "Cl", "OS(=O)(=O)O", "[Na+].[OH-]",
                                           "BrBr", "[Mg]", "O=[Mn](=O)(=O)[O-].[K+]" };
    static const char *const not[] = { "C", "O=C=O", "[C-]#[O+]", "[Na+].[C-]#N", "*", "*O",
                                       "O.C" };
    folder *d = *state;
    bs_shelf *shelf = new_shelf(d);

    for (size_t i = 0; i < sizeof at_hand / sizeof *at_hand; i++)
        check_price(d, shelf, at_hand[i], 0);
    for (size_t i = 0; i < sizeof not / sizeof *not; i++)
        check_price(d, shelf, not[i], -1);
    bs_shelf_free(shelf);
}

/* Molar masses from IUPAC's abridged atomic weights of 2021: C 12.011, H 1.008, O 15.999. */
static void shelf__price_per_gram_times_molar_mass(void **state)
{
    folder *d = *state;
    bs_shelf *shelf = new_shelf(d);
    bs_catalogue *catalogue = open_list(d, "a.csv",
                                        "smiles,code,name,price_per_gram,lead_days\n"
                                        "CCO,E-2,ethanol,0.5,1\nOCC,E-1,ethanol,0.02,3\n"
                                        "O,W,water,0.001,\nCO,M,methanol,,\nN,A,ammonia,,\n");
    bs_offer offer;

    check_ok(d->f, bs_shelf_add_catalogue(&d->f->cx, shelf, catalogue));
    check_price(d, shelf, "CCO", 0.02 * (2 * 12.011 + 6 * 1.008 + 15.999));
    check_price(d, shelf, "O", 0.001 * (2 * 1.008 + 15.999));
    check_price(d, shelf, "CO", 1); /* no price stated, as in a list */
    check_price(d, shelf, "N", 0);  /* no price stated, no carbon */
    price(d, shelf, "C(O)C", &offer);
    assert_string_equal(offer.code, "E-1");
    assert_true(offer.lead_days == 3);
    price(d, shelf, "N", &offer);
    assert_string_equal(offer.code, "A");
    assert_true(price(d, shelf, "Cl", &offer) == 0);
    assert_null(offer.smiles);
    assert_true(price(d, shelf, "CCC", &offer) == -1);
    assert_null(offer.smiles);
    bs_shelf_free(shelf);
    bs_catalogue_close(catalogue);
}

static void shelf__first_source_wins(void **state)
{
    folder *d = *state;
    bs_shelf *shelf = new_shelf(d);
    bs_catalogue *catalogue = open_list(d, "a.csv", "smiles,price_per_gram\nCCO,1\nCO,1\n");
    bs_offer offer;
    int own, last;

    check_ok(d->f, bs_shelf_add_list(&d->f->cx, shelf, &own));
    check_ok(d->f, bs_shelf_add_catalogue(&d->f->cx, shelf, catalogue));
    check_ok(d->f, bs_shelf_add_list(&d->f->cx, shelf, &last));
    put(d, shelf, last, "CO", 0.5);
    put(d, shelf, last, "CCC", 7);
    put(d, shelf, own, "OCC", 900);
    put(d, shelf, own, "O", 4);
    check_price(d, shelf, "CCO", 900);
    check_price(d, shelf, "CO", 12.011 + 4 * 1.008 + 15.999);
    check_price(d, shelf, "CCC", 7);
    check_price(d, shelf, "O", 4);
    price(d, shelf, "CCO", &offer);
    assert_null(offer.smiles);
    bs_shelf_free(shelf);
    bs_catalogue_close(catalogue);
}

static void shelf__lists_keep_the_lower_price(void **state)
{
    folder *d = *state;
    bs_shelf *shelf = new_shelf(d);
    int first, second;

    check_ok(d->f, bs_shelf_add_list(&d->f->cx, shelf, &first));
    check_ok(d->f, bs_shelf_add_list(&d->f->cx, shelf, &second));
    put(d, shelf, first, "CCO", 3);
    put(d, shelf, first, "OCC", 2);
    put(d, shelf, first, "C(C)O", 5);
    put(d, shelf, second, "CCO", 1);
    check_price(d, shelf, "CCO", 2);
    bs_shelf_free(shelf);
}

static void shelf__at_hand_is_free_unless_priced(void **state)
{
    folder *d = *state;
    bs_shelf *shelf = new_shelf(d);
    int list;

    check_ok(d->f, bs_shelf_add_list(&d->f->cx, shelf, &list));
    check_ok(d->f, bs_shelf_at_hand(&d->f->cx, shelf, read_mol(d, "CO")));
    check_ok(d->f, bs_shelf_at_hand(&d->f->cx, shelf, read_mol(d, "CCO")));
    put(d, shelf, list, "CCO", 2);
    check_price(d, shelf, "OC", 0);
    check_price(d, shelf, "CCO", 2);
    bs_shelf_free(shelf);
}

static void shelf__wrong_prices_are_refused(void **state)
{
    folder *d = *state;
    bs_shelf *shelf = new_shelf(d);
    bs_mol *mol = read_mol(d, "C");
    int list;

    assert_int_equal(bs_shelf_put(&d->f->cx, shelf, 0, mol, 1), BS_ERANGE);
    check_ok(d->f, bs_shelf_add_list(&d->f->cx, shelf, &list));
    assert_int_equal(bs_shelf_put(&d->f->cx, shelf, list + 1, mol, 1), BS_ERANGE);
    assert_int_equal(bs_shelf_put(&d->f->cx, shelf, -1, mol, 1), BS_ERANGE);
    assert_int_equal(bs_shelf_put(&d->f->cx, shelf, list, mol, -1), BS_ERANGE);
    assert_int_equal(bs_shelf_put(&d->f->cx, shelf, list, mol, NAN), BS_ERANGE);
    assert_int_equal(bs_shelf_put(&d->f->cx, shelf, list, mol, INFINITY), BS_ERANGE);
    check_price(d, shelf, "C", -1);
    bs_shelf_free(shelf);
}

static void shelf__many_compounds(void **state)
{
    folder *d = *state;
    bs_shelf *shelf = new_shelf(d);
    char smiles[200];
    int list;

    check_ok(d->f, bs_shelf_add_list(&d->f->cx, shelf, &list));
    for (int n = 1; n <= 150; n++) {
        memset(smiles, 'C', (size_t)n);
        strcpy(smiles + n, "O");
        put(d, shelf, list, smiles, n);
    }
    for (int n = 1; n <= 150; n++) {
        memset(smiles + 1, 'C', (size_t)n);
        smiles[0] = 'O';
        smiles[n + 1] = '\0';
        check_price(d, shelf, smiles, n);
    }
    bs_shelf_free(shelf);
}

static void shelf__failed_allocations_change_nothing(void **state)
{
    folder *d = *state;
    bs_gate *gate = d->f->cx.gate;
    bs_mol *mol = read_mol(d, "CCO");
    bs_shelf *shelf = new_shelf(d);
    int list;
    bs_status st = BS_ENOMEM;

    check_ok(d->f, bs_shelf_add_list(&d->f->cx, shelf, &list));
    for (long n = 0; st == BS_ENOMEM && n < 10000; n++) {
        check_price(d, shelf, "CCO", -1);
        atomic_store(&gate->fail_after, n);
        st = bs_shelf_put(&d->f->cx, shelf, list, mol, 2);
        atomic_store(&gate->fail_after, -1);
    }
    check_ok(d->f, st);
    check_price(d, shelf, "CCO", 2);
    bs_shelf_free(shelf);
}

int main(void)
{
    const struct CMUnitTest tests[] = {
        folder_case(shelf__empty_has_what_holds_no_carbon),
        folder_case(shelf__price_per_gram_times_molar_mass),
        folder_case(shelf__first_source_wins),
        folder_case(shelf__lists_keep_the_lower_price),
        folder_case(shelf__at_hand_is_free_unless_priced),
        folder_case(shelf__wrong_prices_are_refused),
        folder_case(shelf__many_compounds),
        folder_case(shelf__failed_allocations_change_nothing),
    };

    return cmocka_run_group_tests(tests, NULL, NULL);
}
