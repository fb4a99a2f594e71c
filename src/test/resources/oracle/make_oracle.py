#!/usr/bin/env python3
"""Applies every one-reactant rule to every molecule of molecules.smi with RDKit and freezes the outcomes.

Why: the rule engine is checked against a toolkit that shares no code with it. The build reads only the
CSV files, so it needs neither Python nor RDKit. Columns and use: README.md beside this file.
"""

import argparse
import csv
import hashlib
import sys
from collections import Counter
from pathlib import Path

import yaml
from rdkit import Chem, RDLogger, rdBase
from rdkit.Chem import AllChem

HERE = Path(__file__).resolve().parent
MAX_PRODUCTS = 1_000_000
WANTED_MOLECULES_PER_RULE = 2
ENOL = Chem.MolFromSmarts("[C;X3]=[C;X3]-[O;X2;H1]")


class Outcome:
    """One application of a rule: what was formed, or why it cannot be trusted."""

    def __init__(self, smiles, fault):
        self.smiles = smiles
        self.fault = fault


def read_molecules(path):
    """SMILES (first column) of each line, in file order; a repeated or unreadable structure is an error."""
    molecules = []
    seen = {}
    for number, line in enumerate(path.read_text(encoding="utf-8").splitlines(), start=1):
        if not line.strip():
            continue
        smiles = line.split()[0]
        molecule = Chem.MolFromSmiles(smiles)
        if molecule is None:
            raise SystemExit(f"{path.name}:{number}: cannot read {smiles}")
        key = Chem.MolToSmiles(molecule)
        if key in seen:
            raise SystemExit(f"{path.name}:{number}: {smiles} repeats line {seen[key]}")
        seen[key] = number
        molecules.append(smiles)
    return molecules


def read_rules(folder):
    """All one-reactant rules of the folder, sorted by id."""
    rules = {}
    for path in sorted(folder.glob("*.yaml")):
        family = yaml.safe_load(path.read_text(encoding="utf-8"))
        for rule in family.get("rules") or []:
            reaction = AllChem.ReactionFromSmarts(rule["smirks"])
            if reaction.GetNumReactantTemplates() != 1:
                continue
            if rule["id"] in rules:
                raise SystemExit(f"{path.name}: rule {rule['id']} stands twice")
            rules[rule["id"]] = rule
    if not rules:
        raise SystemExit(f"no one-reactant rule in {folder}")
    return [rules[rule_id] for rule_id in sorted(rules)]


def compiled(smirks):
    """The reaction with its product side as written, and with the product side held in one piece."""
    left, right = smirks.split(">>")
    as_written = AllChem.ReactionFromSmarts(smirks)
    in_one_piece = AllChem.ReactionFromSmarts(f"{left}>>({right})")
    for reaction in (as_written, in_one_piece):
        reaction.Initialize()
    if in_one_piece.GetNumProductTemplates() != 1:
        raise SystemExit(f"product side not held in one piece: {smirks}")
    return as_written, in_one_piece


def flat(molecule):
    """Canonical SMILES without stereo; written, read and written again so that no history is left in it."""
    smiles = Chem.MolToSmiles(Chem.RemoveHs(molecule), isomericSmiles=False)
    return ".".join(sorted(canonical(part) for part in smiles.split(".")))


def canonical(smiles):
    again = Chem.MolFromSmiles(smiles)
    if again is None:
        raise ValueError(f"own SMILES {smiles} cannot be read again")
    return Chem.MolToSmiles(again, isomericSmiles=False)


def sanitised(product):
    """The product with flags and hydrogen counts worked out anew; raises when valences or rings are impossible."""
    Chem.SanitizeMol(product)
    Chem.Kekulize(product, clearAromaticFlags=True)
    for atom in product.GetAtoms():
        if atom.GetNumRadicalElectrons():
            raise ValueError("a radical centre")
    Chem.SanitizeMol(product)
    return product


def composition(molecules):
    """Atoms of each element, hydrogens included, and the total charge."""
    count = Counter()
    for molecule in molecules:
        for atom in molecule.GetAtoms():
            count[atom.GetSymbol()] += 1
            count["H"] += atom.GetTotalNumHs()
            count["charge"] += atom.GetFormalCharge()
    return {name: number for name, number in count.items() if number}


def imbalance(before, after):
    """What the outcome has too much (+) or too little (-), as text; empty when it balances."""
    names = sorted(set(before) | set(after))
    changes = {name: after.get(name, 0) - before.get(name, 0) for name in names}
    return " ".join(f"{name}{change:+d}" for name, change in changes.items() if change)


def judge(products, before):
    """Turns the raw products of one application into an outcome."""
    raw = ".".join(sorted(Chem.MolToSmiles(product, isomericSmiles=False) for product in products))
    out_of_balance = imbalance(before, raw_composition(products))
    if out_of_balance:
        return Outcome(raw, f"not balanced: {out_of_balance}")
    try:
        ready = [sanitised(product) for product in products]
        return Outcome(".".join(sorted(".".join(map(flat, ready)).split("."))), "")
    except ValueError as impossible:  # RDKit's sanitisation errors are ValueErrors too
        return Outcome(raw, "not sanitised: " + " ".join(str(impossible).split()))


def raw_composition(products):
    """Composition counted before sanitisation, so that hydrogens put in by the toolkit hide nothing."""
    for product in products:
        product.UpdatePropertyCache(strict=False)
    return composition(products)


def apply(reaction, molecule):
    """Every distinct outcome of the reaction on the molecule (hydrogens explicit)."""
    before = composition([molecule])
    raw = reaction.RunReactants((molecule,), maxProducts=MAX_PRODUCTS)
    if len(raw) >= MAX_PRODUCTS:
        raise SystemExit(f"more than {MAX_PRODUCTS} product sets from {Chem.MolToSmiles(molecule)}")
    template = reaction.GetReactantTemplate(0)
    matches = molecule.GetSubstructMatches(template, uniquify=False, maxMatches=MAX_PRODUCTS)
    if len(matches) != len(raw):
        raise SystemExit(f"{len(matches)} matches but {len(raw)} product sets, {Chem.MolToSmiles(molecule)}")
    outcomes = {}
    for products in raw:
        outcome = judge(products, before)
        outcomes[(outcome.smiles, outcome.fault)] = outcome
    return [outcomes[key] for key in sorted(outcomes)]


def enol_positions(outcomes):
    """1-based positions of the outcomes in which some product is a simple enol."""
    positions = []
    for position, outcome in enumerate(outcomes, start=1):
        if Chem.MolFromSmiles(outcome).HasSubstructMatch(ENOL):
            positions.append(str(position))
    return " ".join(positions)


def compare(smiles, rule, as_written, in_one_piece):
    """Outcomes kept for one molecule and rule, the faults seen, and whether the molecule came back unchanged."""
    kept = {outcome.smiles for outcome in in_one_piece if not outcome.fault}
    faults = [(smiles, rule["id"], "one piece", o.smiles, o.fault) for o in in_one_piece if o.fault]
    for outcome in as_written:
        fault = outcome.fault
        if not fault and outcome.smiles not in kept:
            fault = "not among the outcomes of the product side held in one piece"
        if fault:
            faults.append((smiles, rule["id"], "as written", outcome.smiles, fault))
    unchanged = canonical(smiles)
    came_back = unchanged in kept
    return sorted(kept - {unchanged}), faults, came_back


def write(path, header, rows):
    with path.open("w", encoding="utf-8", newline="") as out:
        writer = csv.writer(out, lineterminator="\n")
        writer.writerow(header)
        writer.writerows(rows)


def missing_examples(rules, molecules):
    present = {canonical(smiles) for smiles in molecules}
    for rule in rules:
        for example in rule.get("examples") or []:
            for smiles in example["from"]:
                if canonical(smiles) not in present:
                    yield f"{rule['id']}: its example {smiles} is not in molecules.smi"


def main():
    options = argparse.ArgumentParser(description=__doc__)
    options.add_argument("--rules", type=Path, default=HERE.parents[3] / "rules", help="folder of the rule files")
    options.add_argument("--out", type=Path, default=HERE, help="folder the CSV files are written to")
    chosen = options.parse_args()
    RDLogger.DisableLog("rdApp.*")

    molecules = read_molecules(HERE / "molecules.smi")
    rules = read_rules(chosen.rules)
    prepared = [(smiles, Chem.AddHs(Chem.MolFromSmiles(smiles))) for smiles in molecules]
    rows, faults, unchanged, used = [], [], [], []
    for rule in rules:
        as_written, in_one_piece = compiled(rule["smirks"])
        changed, same = 0, 0
        for smiles, molecule in prepared:
            outcomes, seen_faults, came_back = compare(
                smiles, rule, apply(as_written, molecule), apply(in_one_piece, molecule))
            faults.extend(seen_faults)
            if outcomes:
                changed += 1
                rows.append((smiles, rule["id"], "|".join(outcomes), enol_positions(outcomes)))
            if came_back:
                same += 1
                unchanged.append((smiles, rule["id"]))
        digest = hashlib.sha256(rule["smirks"].encode("utf-8")).hexdigest()
        used.append((rule["id"], digest, changed, same))
        if changed + same < WANTED_MOLECULES_PER_RULE:
            print(f"note: {rule['id']} fires on {changed + same} molecule(s) only", file=sys.stderr)

    rows.sort()
    write(chosen.out / "one-reactant.csv", ("molecule", "rule", "outcomes", "enol_outcomes"), rows)
    write(chosen.out / "unchanged.csv", ("molecule", "rule"), sorted(unchanged))
    write(chosen.out / "toolkit-faults.csv", ("molecule", "rule", "product_side", "outcome", "why"), sorted(faults))
    write(chosen.out / "rules-used.csv", ("rule", "smirks_sha256", "molecules_changed", "molecules_unchanged"), used)
    for line in missing_examples(rules, molecules):
        print(f"note: {line}", file=sys.stderr)
    outcome_count = sum(row[2].count("|") + 1 for row in rows)
    print(f"RDKit {rdBase.rdkitVersion}: {len(molecules)} molecules, {len(rules)} rules, {len(rows)} rows, "
          f"{outcome_count} outcomes, {len(unchanged)} unchanged, {len(faults)} toolkit faults")


if __name__ == "__main__":
    main()
