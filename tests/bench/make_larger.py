#!/usr/bin/python3
"""usage: make_larger.py MOLECULES.smi COUNT > larger.smi

Joins molecules of a list in twos and threes, by bonds that medicinal chemists make (amides,
sulfonamides, esters, ethers, aryl amines, biaryls), to molecules of 20 to 45 heavy atoms. Needs RDKit.
The same input gives the same output.
"""
import random
import sys

from rdkit import Chem, RDLogger
from rdkit.Chem import AllChem

RDLogger.DisableLog("rdApp.*")

JOINTS = [AllChem.ReactionFromSmarts(text) for text in (
    "[C:1](=[O:2])[OX2H].[NX3;H2,H1;!$(NC=O);!$(NS);!$(N[#7,#8]):3]>>[C:1](=[O:2])[N:3]",
    "[C:1](=[O:2])[OX2H].[OX2H:3][#6;!$(C=O):4]>>[C:1](=[O:2])[O:3][#6:4]",
    "[S:1](=[O:2])(=[O:5])[Cl].[NX3;H2,H1;!$(NC=O);!$(NS):3]>>[S:1](=[O:2])(=[O:5])[N:3]",
    "[CX4;H2,H3:1][Cl,Br,I].[OX2H:2][c:3]>>[C:1][O:2][c:3]",
    "[CX4;H2:1][OX2H].[OX2H:2][c:3]>>[C:1][O:2][c:3]",
    "[c:1][Br,I].[NX3;H2,H1;!$(NC=O);!$(NS):2]>>[c:1][N:2]",
    "[c:1][Cl,Br,I].[cH:2]>>[c:1][c:2]",
    "[CX4;H1,H2,H3:1][OX2H].[NX3;H2,H1;!$(NC=O);!$(NS):2]>>[C:1][N:2]",
)]


def join(rng, a, b):
    joint = rng.choice(JOINTS)
    for pair in ((a, b), (b, a)):
        sets = joint.RunReactants(pair)
        if not sets:
            continue
        product = rng.choice(sets)[0]
        try:
            Chem.SanitizeMol(product)
        except ValueError:
            continue
        return product
    return None


def main():
    with open(sys.argv[1], encoding="ascii") as lines:
        pool = [Chem.MolFromSmiles(line.split()[0]) for line in lines]
    pool = [mol for mol in pool if mol and 6 <= mol.GetNumHeavyAtoms() <= 24 and
            len(Chem.GetMolFrags(mol)) == 1 and mol.GetRingInfo().NumRings() > 0]
    rng = random.Random(20)
    seen = set()
    while len(seen) < int(sys.argv[2]):
        mol = join(rng, rng.choice(pool), rng.choice(pool))
        if mol and (mol.GetNumHeavyAtoms() < 22 or rng.random() < 0.3):
            mol = join(rng, mol, rng.choice(pool))
        if not mol or not 20 <= mol.GetNumHeavyAtoms() <= 45:
            continue
        text = Chem.MolToSmiles(mol)
        if text not in seen:
            seen.add(text)
            print(text, "larger-%d" % len(seen), sep="\t")


main()
