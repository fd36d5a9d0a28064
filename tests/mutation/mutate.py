#!/usr/bin/env python3
# SPDX-License-Identifier: MIT
"""Changes one operator or constant of each clause function in turn, and asks whether the tests notice.

    tests/mutation/mutate.py [--workers 2] [--header NAME]...  [--per-function 1]

Works on copies of the tree in a temporary folder; the tree itself is not touched. Prints a line per mutant and a
summary per header; ends with status 1 if a mutant survived. A mutant that does not compile does not count.
"""
import argparse
import concurrent.futures
import os
import pathlib
import re
import shutil
import subprocess
import sys
import tempfile

ROOT = pathlib.Path(__file__).resolve().parents[2]
CLAUSES = pathlib.Path("include/spanledger/clauses")

# Function words and operators that have an opposite; the first that a function holds is changed.
SWAPS = [
    (" + ", " - "), (" - ", " + "), (" * ", " / "), (" / ", " * "), (" <= ", " > "), (" >= ", " < "),
    (" < ", " >= "), (" > ", " <= "), ("least(", "greatest("), ("greatest(", "least("), ("squared(", "cubed("),
    ("cubed(", "squared("), ("fourth(", "cubed("), ("root(", "squared("), ("power(", "least("), ("both(", "either("),
]
NUMBER = re.compile(r"(?<![\w.])(\d+\.\d+)(?![\w.])")


def functions(text):
    """(start, end) of the body of every function that returns a number."""
    for match in re.finditer(r"^(template <class N>\s*)?(inline |constexpr )?[\w:<>]+ \w+\([^;{]*\)\s*\{", text, re.M):
        depth, at = 1, match.end()
        while depth:
            depth += {"{": 1, "}": -1}.get(text[at], 0)
            at += 1
        name = re.search(r"(\w+)\($", text[match.start():match.end()].split("(")[0] + "(").group(1)
        yield name, match.end(), at


def outside_text(body, at):
    """Whether a place of a body is neither in quotes nor in a comment."""
    line = body[body.rfind("\n", 0, at) + 1:at]
    return line.count('"') % 2 == 0 and "//" not in line


def mutants_of(body):
    found = []
    for old, new in SWAPS:
        for match in re.finditer(re.escape(old), body):
            if outside_text(body, match.start()):
                found.append((match.start(), old, new))
    for match in NUMBER.finditer(body):
        if outside_text(body, match.start()):
            value = float(match.group(1))
            found.append((match.start(), match.group(1), repr(value * 1.2 if value else 1.0)))
    return sorted(found)


def chosen(found, count):
    """Spread over the function: the first, then the last, then between."""
    if len(found) <= count:
        return found
    if count == 1:
        return [found[len(found) // 2]]
    step = (len(found) - 1) / (count - 1)
    return [found[round(i * step)] for i in range(count)]


def all_mutants(headers, per_function):
    for header in headers:
        text = (ROOT / header).read_text(encoding="utf-8")
        for name, start, end in functions(text):
            body = text[start:end]
            for at, old, new in chosen(mutants_of(body), per_function):
                changed = text[:start + at] + new + text[start + at + len(old):]
                line = text.count("\n", 0, start + at) + 1
                yield {"header": header, "function": name, "line": line, "old": old.strip(), "new": new.strip(),
                       "text": changed}


class Copy:
    """A copy of the tree with a build of the tests that know clauses, with little optimisation."""

    def __init__(self, folder):
        self.folder = pathlib.Path(folder)
        self.tree = self.folder / "tree"
        shutil.copytree(ROOT, self.tree, ignore=shutil.ignore_patterns("build*", ".git", "output"))
        self.build = self.folder / "build"
        self.run(["cmake", "-S", self.tree, "-B", self.build, "-G", "Ninja", "-DCMAKE_BUILD_TYPE=None", "-DCMAKE_CXX_FLAGS=-O1",
                  "-DSPANLEDGER_CLAUSE_TESTS=ON"], check=True)
        self.run(["ninja", "-C", self.build, "spanledger_clause_tests"], check=True)
        if not self.tests_pass():
            sys.exit("the tests fail before anything is changed")

    def run(self, command, check=False):
        return subprocess.run(command, stdout=subprocess.DEVNULL, stderr=subprocess.DEVNULL, check=check,
                              cwd=self.tree).returncode

    def tests_pass(self):
        return self.run([self.build / "tests/spanledger_clause_tests", "--abort"]) == 0

    def judge(self, mutant):
        path = self.tree / mutant["header"]
        original = path.read_text(encoding="utf-8")
        try:
            path.write_text(mutant["text"], encoding="utf-8")
            if self.run(["ninja", "-C", self.build, "-j1", "spanledger_clause_tests"]) != 0:
                return "does not compile"
            return "survived" if self.tests_pass() else "killed"
        finally:
            path.write_text(original, encoding="utf-8")


def work(mutants, folder):
    copy = Copy(folder)
    results = []
    for mutant in mutants:
        verdict = copy.judge(mutant)
        results.append((mutant, verdict))
        print(f"{verdict:17} {mutant['header'].name}:{mutant['line']} {mutant['function']}: "
              f"{mutant['old']} -> {mutant['new']}", flush=True)
    return results


def main():
    parser = argparse.ArgumentParser(description=__doc__, formatter_class=argparse.RawDescriptionHelpFormatter)
    parser.add_argument("--workers", type=int, default=os.cpu_count() or 1)
    parser.add_argument("--header", action="append", help="only this header of the clauses (without folder)")
    parser.add_argument("--per-function", type=int, default=1)
    options = parser.parse_args()
    headers = sorted(CLAUSES / path.name for path in (ROOT / CLAUSES).glob("*.hpp")
                     if not options.header or path.name in options.header)
    mutants = list(all_mutants(headers, options.per_function))
    print(f"{len(mutants)} mutants in {len(headers)} headers", flush=True)
    with tempfile.TemporaryDirectory() as folder, concurrent.futures.ThreadPoolExecutor(options.workers) as pool:
        shares = [mutants[i::options.workers] for i in range(options.workers)]
        futures = [pool.submit(work, share, f"{folder}/{i}") for i, share in enumerate(shares) if share]
        results = [result for future in futures for result in future.result()]
    survivors = [mutant for mutant, verdict in results if verdict == "survived"]
    killed = sum(verdict == "killed" for _, verdict in results)
    print(f"{killed} killed of {killed + len(survivors)} mutants that compile ({len(results)} made)")
    return 1 if survivors else 0


if __name__ == "__main__":
    sys.exit(main())
