# SPDX-License-Identifier: MIT
"""Reads an issue's workbook, CSV and record back and compares them. Arguments: XLSX CSV JSON [--sample | --more-sheets]."""
import csv
import hashlib
import json
import math
import re
import sys
import zipfile

import openpyxl
from lxml import etree
from openpyxl.utils import range_boundaries

problems = []


def check(condition, words):
    if not condition:
        problems.append(words)


# How Cell.value of a kind is shown: factor, decimals.
KINDS = {
    "permissible span": (0.001, 2),
    "permissible load": (1000.0, 2),
    "utilisation": (1.0, 2),
    "smallest section": (1.0, 2),
}


def shown_letter(cell):
    """The letter that a cell's number format shows behind the number, or None."""
    found = re.search(r'"\s?(.)"$', cell.number_format or "")
    return found.group(1) if found else None


def fill_of(cell):
    if cell.fill is None or cell.fill.fill_type is None:
        return None
    check(cell.fill.fill_type == "solid", f"{cell.coordinate}: pattern fill")
    return cell.fill.fgColor.rgb[-6:]


def check_parts(path):
    with zipfile.ZipFile(path) as archive:
        check(archive.testzip() is None, "damaged archive")
        for name in archive.namelist():
            try:
                etree.fromstring(archive.read(name))
            except etree.XMLSyntaxError as error:
                check(False, f"{name}: {error}")


def check_sheet(sheet, practice):
    name = sheet.title
    check(len(name) <= 31 and not re.search(r"[\[\]:*?/\\]", name), f"sheet name {name}")
    check(sheet.sheet_state == "visible", f"{name}: hidden")
    check(sheet.page_setup.orientation == "landscape", f"{name}: not landscape")
    check(str(sheet.page_setup.paperSize) == "9", f"{name}: not A4")
    check(sheet.sheet_properties.pageSetUpPr is not None and sheet.sheet_properties.pageSetUpPr.fitToPage,
          f"{name}: not fitted")
    check(sheet.page_setup.fitToWidth in (None, 1), f"{name}: not fitted to one page's width")
    check(bool(sheet.print_area), f"{name}: no print area")
    check(bool(sheet.print_title_rows), f"{name}: no repeated rows")
    check(sheet.freeze_panes is not None, f"{name}: no frozen panes")
    check(not sheet.merged_cells.ranges, f"{name}: merged cells")
    header, footer = sheet.oddHeader, sheet.oddFooter
    words = " ".join(str(part.text) for part in (header.left, header.center, header.right, footer.left, footer.right))
    check(practice["number"] in words and practice["revision"] in words, f"{name}: number and revision not on the page")
    check("&P" in str(footer.right.text) or "&[Page]" in str(footer.right.text), f"{name}: no page number")
    check("&N" in str(footer.right.text) or "&[Pages]" in str(footer.right.text), f"{name}: no number of pages")
    for dimension in list(sheet.row_dimensions.values()) + list(sheet.column_dimensions.values()):
        check(not dimension.hidden, f"{name}: something hidden")
    check_cells(sheet)


def check_cells(sheet):
    first_column, first_row, last_column, last_row = range_boundaries(sheet.print_area[0].split("!")[-1])
    for row in sheet.iter_rows():
        for cell in row:
            where = f"{sheet.title}!{cell.coordinate}"
            check(cell.data_type in ("n", "s"), f"{where}: type {cell.data_type}")
            if isinstance(cell.value, float):
                check(math.isfinite(cell.value), f"{where}: not finite")
                check(math.copysign(1.0, cell.value) > 0.0, f"{where}: negative")
            inside = first_row <= cell.row <= last_row and first_column <= cell.column <= last_column
            check(cell.value is None or inside, f"{where}: outside the print area")
            if fill_of(cell) is not None:
                letter = shown_letter(cell) or (cell.value if isinstance(cell.value, str) and len(cell.value) == 1 else None)
                check(letter is not None, f"{where}: a fill without a letter")
            if cell.value is not None and cell.hyperlink is None:
                colour = cell.font.color
                black = colour is None or colour.rgb in ("FF000000", None) or colour.theme == 1 or colour.indexed == 8
                check(black, f"{where}: text is not black")


class Table:
    """A table's sheet, taken apart by the words in its first column."""

    def __init__(self, sheet):
        self.sheet = sheet
        labels = {sheet.cell(row, 1).value: row for row in range(1, sheet.max_row + 1)}
        self.number = int(re.match(r"Table (\d+)  ", sheet.cell(1, 1).value).group(1))
        self.load_row = labels["Load class"]
        self.spacing_row = labels["Spacing, c/c"]
        self.span_row = labels.get("Clear span")
        self.unit_row = labels["Class"]
        self.first_row = self.unit_row + 1
        self.columns = [c for c in range(3, sheet.max_column + 1) if sheet.cell(self.spacing_row, c).value is not None]
        self.rows = []
        for row in range(self.first_row, sheet.max_row + 1):
            if sheet.cell(row, 1).value is None:
                break
            self.rows.append(row)
        self.reasons = self.read_reasons()

    def read_reasons(self):
        text = ""
        for row in range(1, self.load_row):
            value = self.sheet.cell(row, 1).value
            if isinstance(value, str) and (value.startswith("Where there is") or (text and value)):
                text += " " + value
        return dict(re.findall(r"– (\d+)\)  (.*?)(?=    – |$)", text))

    def loads(self):
        """Load class of each column: its name's lines stand over the first column of its group."""
        names, current = [], None
        for column in self.columns:
            starts = self.sheet.cell(self.load_row, column).value is not None
            if starts:
                lines = [self.sheet.cell(row, column).value for row in range(self.load_row, self.spacing_row)]
                current = " ".join(line for line in lines if line)
            names.append(current)
        return names


def legend_of(sheet, last_row):
    """Letters of the legend, with their fills."""
    letters = {}
    for row in sheet.iter_rows(min_row=1, max_row=last_row):
        for cell in row:
            if isinstance(cell.value, str) and len(cell.value) == 1:
                letters[cell.value] = fill_of(cell)
    return letters


def compare_cell(table, cell, recorded, record, legend):
    fields = dict(zip(record["cell_fields"], recorded))
    where = f"{table.sheet.title}!{cell.coordinate}"
    scale, decimals = KINDS[record_table(table, record)["kind"]]
    if fields["value"] is None:
        found = re.fullmatch(r"– (\d+)\)", str(cell.value))
        check(found is not None and table.reasons.get(found.group(1)) == fields["reason"], f"{where}: no reason ({cell.value})")
        check(fill_of(cell) is None, f"{where}: filled without a value")
        return
    letter = shown_letter(cell)
    check(letter == (fields["governing"] or "–"), f"{where}: letter {letter}, not {fields['governing']}")
    check(letter in legend, f"{where}: letter {letter} is not in the legend")
    check(fill_of(cell) == legend.get(letter), f"{where}: fill differs from the legend's")
    if fields["text"] is not None:
        check(cell.value == fields["text"], f"{where}: {cell.value}, not {fields['text']}")
        return
    check(abs(cell.value - fields["value"] * scale) < 1e-12 * max(1.0, cell.value), f"{where}: {cell.value}")
    check(cell.number_format.startswith("0." + "0" * decimals + '"'), f"{where}: format {cell.number_format}")


def record_table(table, record):
    return record["tables"][table.number - 1]


def compare_tables(workbook, record):
    done = [[[False] * len(t["columns"]) for _ in t["rows"]] for t in record["tables"]]
    sheets = [s for s in workbook.worksheets if str(s.cell(1, 1).value).startswith("Table ")]
    for sheet in sheets:
        table = Table(sheet)
        recorded = record_table(table, record)
        legend = legend_of(sheet, table.load_row)
        titles = sheet.print_title_rows.replace("$", "").split(":")
        check(int(titles[0]) <= table.load_row - 2 and int(titles[1]) == table.unit_row, f"{sheet.title}: repeats {titles}")
        height = sum(sheet.row_dimensions[row].height for row in range(1, table.first_row))
        frozen = "C1" if height > 300 else f"C{table.first_row}"  # a head that fills the screen must scroll
        check(sheet.freeze_panes == frozen, f"{sheet.title}: frozen at {sheet.freeze_panes}")
        heads = [(load, sheet.cell(table.spacing_row, c).value,
                  sheet.cell(table.span_row, c).value if table.span_row else None)
                 for load, c in zip(table.loads(), table.columns)]
        wanted = [(c["load"], c["spacing_mm"], None if c["clear_span_mm"] is None else c["clear_span_mm"] / 1000)
                  for c in recorded["columns"]]
        start = next(i for i in range(len(wanted)) if wanted[i:i + len(heads)] == heads)
        check(len(table.rows) == len(recorded["rows"]), f"{sheet.title}: {len(table.rows)} rows")
        for r, row in enumerate(table.rows):
            head = recorded["rows"][r]
            second = head["section"] if head["clear_span_mm"] is None else head["clear_span_mm"] / 1000
            check(sheet.cell(row, 1).value == head["class"], f"{sheet.title}: class in row {row}")
            check(sheet.cell(row, 2).value == second, f"{sheet.title}: row head in row {row}")
            for c, column in enumerate(table.columns):
                compare_cell(table, sheet.cell(row, column), recorded["cells"][r][start + c], record, legend)
                done[table.number - 1][r][start + c] = True
    check(all(cell for t in done for row in t for cell in row), "some cells stand on no sheet")
    return sheets


def compare_csv(path, record):
    with open(path, encoding="utf-8", newline="") as file:
        text = file.read()
    check("\r\n" in text and "\n" not in text.replace("\r\n", ""), "CSV: line ends")
    lines = list(csv.DictReader(text.splitlines()))
    limits = [limit["limit"] for limit in record["tables"][0]["limits"]]
    columns = [re.sub("[ -]", "_", limit) + "_clear_span_m" for limit in limits]
    check(list(lines[0]) == "table,kind,material,class,section,spacing_mm,load,clear_span_m,load_kN_m2,utilisation,"
          "governing,next_limit,reason".split(",") + columns, "CSV: columns")
    letters = {limit["letter"]: limit["limit"] for limit in record["tables"][0]["limits"]}
    number = 0
    for table in record["tables"]:
        for head, row in zip(table["rows"], table["cells"]):
            for over, recorded in zip(table["columns"], row):
                cell = dict(zip(record["cell_fields"], recorded))
                compare_line(lines[number], number, table, head, over, cell, letters)
                number += 1
    check(number == len(lines), f"CSV: {len(lines)} lines for {number} cells")
    for line in lines:
        for value in line.values():
            check(not value.startswith(("=", "+", "-", "@")), f"CSV: {value} may be taken for a formula")


def plain(text):
    return text[1:] if text.startswith("'") else text


def compare_line(line, number, table, head, over, cell, letters):
    def same(column, wanted):
        check(plain(line[column]) == wanted, f"CSV line {number + 2}: {column} is {line[column]}, not {wanted}")

    def close(column, wanted, tolerance):
        ok = line[column] == "" if wanted is None else line[column] != "" and abs(float(line[column]) - wanted) <= tolerance
        check(ok, f"CSV line {number + 2}: {column} is {line[column]}, not {wanted}")

    same("table", table["name"])
    same("kind", table["kind"])
    same("material", table["material"])
    same("class", head["class"])
    same("section", cell["text"] or "" if table["kind"] == "smallest section" else head["section"])
    close("spacing_mm", over["spacing_mm"], 0)
    same("load", over["load"])
    given = head["clear_span_mm"] or over["clear_span_mm"]
    span = cell["value"] if table["kind"] == "permissible span" else given
    close("clear_span_m", None if span is None else span / 1000, 1e-12)
    load = cell["value"] if table["kind"] == "permissible load" else None
    close("load_kN_m2", None if load is None else load * 1000, 1e-9)
    if cell["value"] is None:
        same("utilisation", "")
    else:
        close("utilisation", cell["utilisation"], 1.0001e-4)
        check(float(line["utilisation"]) >= cell["utilisation"] - 1e-9, f"CSV line {number + 2}: utilisation rounded down")
    same("governing", letters.get(cell["governing"], ""))
    same("next_limit", letters.get(cell["next"], ""))
    same("reason", cell["reason"] or "")
    spans = dict(zip(table["limits_in_cells"], cell["clear_spans_mm"]))
    for limit in letters.values():
        column = re.sub("[ -]", "_", limit) + "_clear_span_m"
        span = spans.get(limit)
        if span is None or span is False:
            same(column, "")
        else:
            same(column, f"{math.floor(span + 1e-7) / 1000:.3f}")


def check_sample(record, workbook):
    """The numbers of the sample, worked out from its description in sample_issue.hpp."""
    table = record["tables"][0]
    order = "MVCRBQIFHUPS"
    for r in range(40):
        for c in range(9):
            n = 9 * r + c
            cell = dict(zip(record["cell_fields"], table["cells"][r][c]))
            if n % 23 == 5:
                check(cell["value"] is None and cell["reason"] in ("class 4", "no span above the lower bound"), f"sample {n}")
            elif n % 29 == 7:
                check(cell["value"] == 30000 and cell["governing"] is None, f"sample {n}")
            else:
                permissible = 1503.0 + 211.37 * r - 37.11 * c
                check(cell["value"] == math.floor(permissible / 10) * 10, f"sample {n}: {cell['value']}")
                check(cell["permissible"] == permissible, f"sample {n}: {cell['permissible']}")
                check(cell["governing"] == order[n % 12], f"sample {n}: {cell['governing']}")
    loads = record["brief"]["load"]
    check([load["permanent_kN_m2"] for load in loads] == [0.25, 0.5, 1.25], "sample: permanent loads")
    check(loads[0]["concentrated_kN"] == 2 and loads[0]["variable_kN_m2"] == 1.5, "sample: loads")
    check(record["brief"]["limits"]["vibration"]["floor_width_m"] == 4, "sample: floor width")
    properties = workbook.properties
    check(properties.created.isoformat() == "2026-01-31T00:00:00", f"created {properties.created}")
    cover = [str(cell.value) for row in workbook["Cover"].iter_rows() for cell in row if cell.value is not None]
    check(any(text.startswith("NOT CHECKED") for text in cover), "the cover does not say that nobody checked")
    check(any("1 seen in their source, 1 recalled" in text for text in cover), "the cover does not count recalled values")
    check(any(text.startswith("'=Joists") or text.startswith("=Joists") for text in cover), "the title is not text")


def check_cover(workbook, record):
    check(workbook.worksheets[0].title == "Cover", "the first sheet is not the cover")
    links = {}
    for row in workbook["Cover"].iter_rows():
        for cell in row:
            if cell.hyperlink is not None:
                links[cell.value] = cell.hyperlink.location
    others = [sheet.title for sheet in workbook.worksheets[1:]]
    check(list(links) == others, f"the cover lists {list(links)}")
    for name, location in links.items():
        check(location == "'" + name.replace("'", "''") + "'!A1", f"link to {location}")
    cover = " ".join(str(cell.value) for row in workbook["Cover"].iter_rows() for cell in row if cell.value is not None)
    check(record["fingerprint"] in cover, "the cover lacks the fingerprint")
    for part in ("number", "revision", "title", "prepared"):
        check(record["brief"]["practice"][part] in cover, f"the cover lacks the {part}")


def check_properties(path, record):
    with zipfile.ZipFile(path) as archive:
        custom = etree.fromstring(archive.read("docProps/custom.xml"))
        core = archive.read("docProps/core.xml").decode()
    values = {child.get("name"): "".join(child.itertext()) for child in custom}
    practice = record["brief"]["practice"]
    check(values == {"Number": practice["number"], "Revision": practice["revision"],
                     "Program": "spanledger " + record["program_version"], "Fingerprint": record["fingerprint"]},
          f"properties {values}")
    title = etree.fromstring(core.encode()).find("{http://purl.org/dc/elements/1.1/}title")
    check(title is not None and title.text == practice["title"], "the title property")


def check_fingerprint(path, record):
    with open(path, encoding="utf-8", newline="") as file:
        lines = file.read().split("\n")
    without = "\n".join(line for line in lines if not line.startswith(' "fingerprint":'))
    check(hashlib.sha256(without.encode()).hexdigest()[:16] == record["fingerprint"], "fingerprint")


def main():
    book_path, csv_path, record_path, *modes = sys.argv[1:]
    with open(record_path, encoding="utf-8") as file:
        record = json.load(file)
    check_parts(book_path)
    workbook = openpyxl.load_workbook(book_path)
    names = [sheet.title.casefold() for sheet in workbook.worksheets]
    check(len(set(names)) == len(names), "sheet names are not unique")
    for sheet in workbook.worksheets:
        check_sheet(sheet, record["brief"]["practice"])
    sheets = compare_tables(workbook, record)
    compare_csv(csv_path, record)
    check_cover(workbook, record)
    check_properties(book_path, record)
    check_fingerprint(record_path, record)
    if "--sample" in modes:
        check_sample(record, workbook)
    if "--more-sheets" in modes:
        check(len(sheets) > len(record["tables"]), "the table stands on one sheet")
    print("\n".join(problems[:40]))
    return 1 if problems else 0


sys.exit(main())
