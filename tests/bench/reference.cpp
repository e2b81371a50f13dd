/*
 * The tasks of run.lua done by RDKit's C++ library, as the yardstick of their speed. Arguments and
 * output are those of run.lua, seconds are CPU time of the thread. The library is used as one finds
 * it: sanitised molecules, no screen before the matcher, products sanitised and named one by one.
 */
#include <cstdio>
#include <cstdlib>
#include <ctime>
#include <fstream>
#include <memory>
#include <set>
#include <string>
#include <vector>

#include <GraphMol/ChemReactions/Reaction.h>
#include <GraphMol/ChemReactions/ReactionParser.h>
#include <GraphMol/GraphMol.h>
#include <GraphMol/MolOps.h>
#include <GraphMol/SmilesParse/SmilesParse.h>
#include <GraphMol/SmilesParse/SmilesWrite.h>
#include <GraphMol/Substruct/SubstructMatch.h>
#include <RDGeneral/RDLog.h>

using Molecule = RDKit::ROMOL_SPTR;

static double cpu_seconds()
{
    timespec now;

    clock_gettime(CLOCK_THREAD_CPUTIME_ID, &now);
    return static_cast<double>(now.tv_sec) + 1e-9 * static_cast<double>(now.tv_nsec);
}

/* Does the work and prints its line. */
template <typename Work> static void measure(const char *task, size_t items, Work work)
{
    double start = cpu_seconds();

    work();
    double seconds = cpu_seconds() - start;
    std::printf("%s\t%zu\t%.4f\t%.1f\n", task, items, seconds,
                static_cast<double>(items) / seconds);
}

static std::vector<std::string> first_words(const char *path, size_t most)
{
    std::ifstream file(path);
    std::vector<std::string> words;
    std::string line;

    if (!file) {
        std::fprintf(stderr, "%s: cannot be read\n", path);
        std::exit(1);
    }
    while (std::getline(file, line) && (most == 0 || words.size() < most)) {
        std::string word = line.substr(0, line.find_first_of(" \t\r"));

        if (!word.empty() && word != "#")
            words.push_back(word);
    }
    return words;
}

/* The molecule, or nothing where the library refuses the text. */
static Molecule read(const std::string &text)
{
    try {
        return Molecule(RDKit::SmilesToMol(text));
    } catch (const std::exception &) {
        return Molecule();
    }
}

/* The names of one set of products, sorted, in a row; empty where a product does not sanitise. */
static std::string name_set(const RDKit::MOL_SPTR_VECT &set)
{
    std::multiset<std::string> names;
    std::string row;

    for (const auto &product : set) {
        auto &mol = dynamic_cast<RDKit::RWMol &>(*product);

        try {
            RDKit::MolOps::sanitizeMol(mol);
        } catch (const std::exception &) {
            return std::string();
        }
        names.insert(RDKit::MolToSmiles(mol));
    }
    for (const auto &name : names)
        row += name + ' ';
    return row;
}

/* Number of distinct sets of products of one template on one molecule. */
static size_t run_template(RDKit::ChemicalReaction &reaction, const Molecule &mol)
{
    std::set<std::string> distinct;

    for (const auto &set : reaction.runReactants(RDKit::MOL_SPTR_VECT{mol})) {
        std::string names = name_set(set);

        if (!names.empty())
            distinct.insert(names);
    }
    return distinct.size();
}

int main(int argc, char **argv)
{
    if (argc != 5) {
        std::fprintf(stderr, "usage: %s MOLECULES.smi AT_MOST SMARTS.txt REACTIONS.txt\n", argv[0]);
        return 2;
    }
    RDLog::InitLogs();
    boost::logging::disable_logs("rdApp.*");

    auto texts = first_words(argv[1], std::strtoul(argv[2], nullptr, 10));
    std::vector<std::unique_ptr<RDKit::ROMol>> patterns;
    std::vector<std::unique_ptr<RDKit::ChemicalReaction>> reactions;
    for (const auto &text : first_words(argv[3], 0))
        patterns.emplace_back(RDKit::SmartsToMol(text));
    for (const auto &text : first_words(argv[4], 0)) {
        reactions.emplace_back(RDKit::RxnSmartsToChemicalReaction(text));
        reactions.back()->initReactantMatchers();
    }
    std::puts("task\titems\tseconds\titems_per_second");

    std::vector<Molecule> mols;
    measure("read", texts.size(), [&] {
        for (const auto &text : texts) {
            if (Molecule mol = read(text))
                mols.push_back(mol);
        }
    });
    size_t bytes = 0, hits = 0, sets = 0;
    measure("write", mols.size(), [&] {
        for (const auto &mol : mols)
            bytes += RDKit::MolToSmiles(*mol).size();
    });
    measure("match", mols.size() * patterns.size(), [&] {
        RDKit::MatchVectType match;

        for (const auto &mol : mols) {
            for (const auto &pattern : patterns)
                hits += RDKit::SubstructMatch(*mol, *pattern, match, true, true);
        }
    });
    measure("rewrite", mols.size() * reactions.size(), [&] {
        for (const auto &mol : mols) {
            for (const auto &reaction : reactions)
                sets += run_template(*reaction, mol);
        }
    });
    std::printf("# molecules %zu, bytes written %zu, hits %zu, product sets %zu\n", mols.size(),
                bytes, hits, sets);
    return 0;
}
