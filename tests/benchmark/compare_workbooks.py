# SPDX-License-Identifier: MIT
"""compare_workbooks.py BARE ISSUE: exit status 0 where every number of BARE's sheets stands in the same order in ISSUE's."""
import re
import sys
import zipfile


def numbers(part):
    """Values of the number cells of a sheet, in the order of the sheet."""
    cells = re.findall(rb'<c r="[A-Z]+(\d+)"(?: s="\d+")?><v>([^<]+)</v>', part)
    return [(int(row), value) for row, value in cells]


def sheets(file):
    with zipfile.ZipFile(file) as book:
        count = sum(1 for name in book.namelist() if name.startswith("xl/worksheets/sheet"))
        return [numbers(book.read(f"xl/worksheets/sheet{i + 1}.xml")) for i in range(count)]


def contains(outer, inner):
    rest = iter(outer)
    return all(value in rest for value in inner)


def main():
    heads = 3  # rows of the bare sheets above the spans
    remaining = iter(sheets(sys.argv[2]))
    for bare in sheets(sys.argv[1]):
        spans = [value for row, value in bare if row > heads]
        if not any(contains((value for _, value in issued), spans) for issued in remaining):
            return 1
    return 0


sys.exit(main())
