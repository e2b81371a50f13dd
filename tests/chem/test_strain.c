/*
 * Bonds that rings cannot hold. Bredt's rule and the smallest rings that hold an alkyne, an allene
 * or a trans alkene: F. A. Carey and R. J. Sundberg, Advanced Organic Chemistry, Part A; J.
 * Clayden, N. Greeves and S. Warren, Organic Chemistry; both from memory.
 */
#include "support/molecule.h"

#include "backsaw/mol.h"

static bs_strain strain_of(fixture *f, const char *smiles)
{
    bs_strain kind;
    int bond;

    check_ok(f, bs_mol_strain(&f->cx, molecule_read(f, smiles), 0, &kind, &bond));
    assert_true((bond >= 0) == (kind != BS_STRAIN_NONE));
    return kind;
}

static void check_all(fixture *f, const char *const *smiles, size_t count, bs_strain expected)
{
    for (size_t i = 0; i < count; i++) {
        if (strain_of(f, smiles[i]) != expected)
            fail_msg("%s: %d is expected, not %d", smiles[i], expected, strain_of(f, smiles[i]));
    }
}

static void strain__of_compounds_that_are_sold_or_well_known_is_none(void **state)
{
    static const char *const fine[] = {
        "C1CCC2=CCCCC2C1",                     /* octalin */
        "C1CCC2=C(C1)CCCC2",                   /* octalin with the fusion bond double */
        "C1CC2=CCCC2C1",                       /* bicyclo[3.3.0]oct-1-ene */
        "C1CC2CC1C=C2",                        /* norbornene */
        "CC1=CCC2CC1C2(C)C",                   /* alpha-pinene */
        "C1CCC2CCC(=C2C1)C",                   /* fused, tetrasubstituted */
        "C1CC2CCCC(=C1)C2",                    /* bicyclo[3.3.1]non-1-ene: trans in eight members */
        "CC(C)=C1CC2CCC1C2",                   /* exocyclic */
        "C1CCC#CCCC1",                         /* cyclooctyne */
        "C1CCCC=C=CCC1",                       /* cyclonona-1,2-diene */
        "CC12CCC3C(CCC4=CC(=O)CCC34C)C1CCC2O", /* testosterone */
        "c1ccc2c(c1)CC=C2",                    /* indene */
        "CC1=C2C(C(=O)C3(C(CC4C(C3C(C(C2(C)C)(CC1O)O)OC(=O)C)(CO4)OC(=O)C)O)C)O",
        "C12=C(C=C3C(=C1)C(=O)C4C5=C(C(=O)CCC53)CO4)C=CC=C2", /* three rings meet at an atom */
        "O=C1CC2CCC1C2",                                      /* norcamphor */
        "C1=CC2CCC1O2",
    };

    check_all(*state, fine, sizeof fine / sizeof *fine, BS_STRAIN_NONE);
}

static void strain__of_small_bridged_alkenes_is_seen(void **state)
{
    static const char *const bridged[] = {
        "C1CC2=CCC1C2",        /* norborn-1-ene */
        "C1CC2=CCC1CC2",       /* bicyclo[2.2.2]oct-1-ene */
        "C1CC2CCC(=C1)C2",     /* bicyclo[3.2.1]oct-1-ene */
        "O=C1C2=CCC(C1)C2",    /* a bridgehead enone */
        "C1C2CC3CC1C=C(C2)C3", /* adamantene */
    };

    check_all(*state, bridged, sizeof bridged / sizeof *bridged, BS_STRAIN_BRIDGEHEAD);
}

static void strain__of_linear_bonds_in_small_rings_is_seen(void **state)
{
    static const char *const alkynes[] = {"C1CCC#CCC1", "C1CCC#CC1", "C1CC#C1"};
    static const char *const allenes[] = {"C1CC=C=CC1", "C1CCC=C=CCC1"};

    check_all(*state, alkynes, sizeof alkynes / sizeof *alkynes, BS_STRAIN_ALKYNE);
    check_all(*state, allenes, sizeof allenes / sizeof *allenes, BS_STRAIN_ALLENE);
}

static void strain__names_the_bond_and_goes_on_behind_it(void **state)
{
    fixture *f = *state;
    bs_mol *mol = molecule_read(f, "C1CC2=CCC1C2.C1CCC#CC1");
    bs_strain kind;
    int bond, a, b;

    check_ok(f, bs_mol_strain(&f->cx, mol, 0, &kind, &bond));
    bs_mol_bond_ends(mol, bond, &a, &b);
    assert_int_equal(a, 2);
    assert_int_equal(b, 3);
    check_ok(f, bs_mol_strain(&f->cx, mol, bond + 1, &kind, &bond));
    assert_int_equal(kind, BS_STRAIN_ALKYNE);
    check_ok(f, bs_mol_strain(&f->cx, mol, bond + 1, &kind, &bond));
    assert_int_equal(kind, BS_STRAIN_NONE);
}

int main(void)
{
    const struct CMUnitTest tests[] = {
        check_case(strain__of_compounds_that_are_sold_or_well_known_is_none),
        check_case(strain__of_small_bridged_alkenes_is_seen),
        check_case(strain__of_linear_bonds_in_small_rings_is_seen),
        check_case(strain__names_the_bond_and_goes_on_behind_it),
    };

    return cmocka_run_group_tests(tests, NULL, NULL);
}
