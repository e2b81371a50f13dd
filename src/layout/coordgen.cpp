/*
 * Calls coordgen; no exception leaves this file. coordgen keeps no state between calls that
 * changes, so several threads may call it.
 */
#include "layout/coordgen.h"

#include <coordgen/sketcherMinimizer.h>

#include <algorithm>
#include <cmath>
#include <memory>
#include <new>
#include <vector>

namespace
{

using atom_list = std::vector<sketcherMinimizerAtom *>;

/*
 * How many pairs of bonds are looked at for crossings, summed over all tries to avoid them. A drug
 * molecule takes thousands to millions; a crowded one of 200 atoms would take minutes.
 */
constexpr long MOST_LOOKS = 40000000;

/*
 * A bond that counts how often coordgen looks at it, which it does by asking whether this is a
 * bond between residues of proteins, since those may be crossed. When the looks are used up, the
 * answer is yes: crossings are no longer avoided, and the search comes to its end soon. Counting
 * looks instead of time keeps the result the same on every machine.
 */
class counting_bond : public sketcherMinimizerBond
{
  public:
    long *left = nullptr;

    bool isResidueInteraction() override
    {
        if (*left <= 0)
            return true;
        --*left;
        return false;
    }
};

/* The parts of a molecule until the minimizer takes them. */
struct parts {
    std::vector<std::unique_ptr<sketcherMinimizerAtom>> atoms;
    std::vector<std::unique_ptr<counting_bond>> bonds;
    std::unique_ptr<sketcherMinimizerMolecule> molecule;
};

/* `count` new objects in the order of their addresses. */
template <typename T> std::vector<std::unique_ptr<T>> make_sorted(std::uint32_t count)
{
    std::vector<std::unique_ptr<T>> made;

    made.reserve(count);
    for (std::uint32_t i = 0; i < count; i++)
        made.push_back(std::make_unique<T>());
    std::sort(made.begin(), made.end(),
              [](const std::unique_ptr<T> &x, const std::unique_ptr<T> &y) {
                  return std::less<const T *>()(x.get(), y.get());
              });
    return made;
}

void set_geometry(sketcherMinimizerBond &bond, const bs_coordgen_bond &from, const atom_list &atoms)
{
    sketcherMinimizerBondStereoInfo info;

    if (from.geometry == 0)
        return;
    info.atom1 = atoms[from.beside_a];
    info.atom2 = atoms[from.beside_b];
    info.stereo = from.geometry == 1 ? sketcherMinimizerBondStereoInfo::cis
                                     : sketcherMinimizerBondStereoInfo::trans;
    bond.setStereoChemistry(info);
}

/* Builds the molecule and gives its parts over to the minimizer. */
atom_list load(sketcherMinimizer &minimizer, std::uint32_t atom_count, const std::uint8_t *elements,
               std::uint32_t bond_count, const bs_coordgen_bond *bonds, long *looks)
{
    parts p;
    atom_list atoms;

    p.atoms = make_sorted<sketcherMinimizerAtom>(atom_count);
    p.bonds = make_sorted<counting_bond>(bond_count);
    p.molecule = std::make_unique<sketcherMinimizerMolecule>();
    atoms.reserve(atom_count);
    p.molecule->_atoms.reserve(atom_count);
    p.molecule->_bonds.reserve(bond_count);
    for (std::uint32_t i = 0; i < atom_count; i++) {
        p.atoms[i]->setAtomicNumber(elements[i]);
        p.atoms[i]->molecule = p.molecule.get();
        atoms.push_back(p.atoms[i].get());
    }
    for (std::uint32_t i = 0; i < bond_count; i++) {
        p.bonds[i]->left = looks;
        p.bonds[i]->startAtom = atoms[bonds[i].a];
        p.bonds[i]->endAtom = atoms[bonds[i].b];
        p.bonds[i]->setBondOrder(bonds[i].order);
        set_geometry(*p.bonds[i], bonds[i], atoms);
    }
    /* From here on nothing fails until the minimizer owns all. */
    for (auto &atom : p.atoms)
        p.molecule->_atoms.push_back(atom.release());
    for (auto &bond : p.bonds)
        p.molecule->_bonds.push_back(bond.release());
    minimizer.initialize(p.molecule.release());
    return atoms;
}

/* Whether all places are numbers of a sane size and do not coincide. */
bool are_usable(const double *places, std::uint32_t count)
{
    bool spread = count < 2;

    for (std::uint32_t i = 0; i < count; i++) {
        const double *at = places + 2 * static_cast<std::size_t>(i);

        if (!std::isfinite(at[0]) || !std::isfinite(at[1]) || std::fabs(at[0]) > 1e4 ||
            std::fabs(at[1]) > 1e4)
            return false;
        spread |= at[0] != places[0] || at[1] != places[1];
    }
    return spread;
}

} // namespace

bs_coordgen_result bs_coordgen__place(uint32_t atom_count, const uint8_t *elements,
                                      uint32_t bond_count, const bs_coordgen_bond *bonds, bool open,
                                      double *places)
{
    long looks = MOST_LOOKS;

    try {
        sketcherMinimizer minimizer;
        atom_list atoms = load(minimizer, atom_count, elements, bond_count, bonds, &looks);

        if (open)
            minimizer.setForceOpenMacrocycles(true);
        minimizer.runGenerateCoordinates();
        for (std::uint32_t i = 0; i < atom_count; i++) {
            double *at = places + 2 * static_cast<std::size_t>(i);

            at[0] = static_cast<double>(atoms[i]->coordinates.x()) / BONDLENGTH;
            at[1] = static_cast<double>(atoms[i]->coordinates.y()) / BONDLENGTH;
        }
        return are_usable(places, atom_count) ? BS_COORDGEN_DONE : BS_COORDGEN_REFUSED;
    } catch (const std::bad_alloc &) {
        return BS_COORDGEN_NO_MEMORY;
    } catch (...) {
        return BS_COORDGEN_REFUSED;
    }
}
