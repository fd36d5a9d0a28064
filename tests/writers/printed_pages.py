# SPDX-License-Identifier: MIT
"""Prints an issue's workbook to PDF and looks at where its words stand. Arguments: XLSX CSV JSON."""
import json
import os
import re
import subprocess
import sys
import tempfile

import openpyxl
from lxml import etree

problems = []


def check(condition, words):
    if not condition:
        problems.append(words)


def print_to_pdf(workbook, folder):
    profile = "file://" + os.path.join(folder, "profile")
    subprocess.run(["soffice", "-env:UserInstallation=" + profile, "--headless", "--convert-to", "pdf", "--outdir", folder,
                    workbook], check=True, stdout=subprocess.DEVNULL, stderr=subprocess.DEVNULL, timeout=300)
    return os.path.join(folder, os.path.basename(workbook)[:-len(".xlsx")] + ".pdf")


def pages_of(pdf, folder):
    boxes = os.path.join(folder, "boxes.html")
    subprocess.run(["pdftotext", "-bbox", pdf, boxes], check=True)
    root = etree.parse(boxes, etree.XMLParser(recover=True)).getroot()
    pages = []
    for page in root.iter("{*}page"):
        size = float(page.get("width")), float(page.get("height"))
        words = [(word.text or "", [float(word.get(side)) for side in ("xMin", "yMin", "xMax", "yMax")])
                 for word in page.iter("{*}word")]
        pages.append((size, words))
    return pages


def overlap(a, b):
    """Common area as a share of the smaller box."""
    width = min(a[2], b[2]) - max(a[0], b[0])
    height = min(a[3], b[3]) - max(a[1], b[1])
    if width <= 0 or height <= 0:
        return 0.0
    smaller = min((box[2] - box[0]) * (box[3] - box[1]) for box in (a, b))
    return width * height / smaller if smaller > 0 else 0.0


def check_page(number, count, size, words, record):
    text = " ".join(word for word, _ in words)
    check(f"page {number} of {count}" in text, f"page {number}: no page n of N")
    practice = record["brief"]["practice"]
    check(f"{practice['number']}, revision {practice['revision']}" in text, f"page {number}: number and revision")
    check(size[0] > size[1], f"page {number}: not landscape")
    for word, box in words:
        check(box[0] >= 0 and box[1] >= 0 and box[2] <= size[0] and box[3] <= size[1], f"page {number}: {word} off the page")
    for i, (word, box) in enumerate(words):
        for other, other_box in words[i + 1:]:
            # Boxes reach over the full height of a line: neighbouring lines touch by a little.
            check(overlap(box, other_box) < 0.2, f"page {number}: {word} lies on {other}")
    return text


def check_words(workbook, texts):
    """All words of all cells are on paper."""
    printed = set(re.split(r"\s+", " ".join(texts)))
    squeezed = re.sub(r"\s+", "", "".join(texts))
    for sheet in workbook.worksheets:
        for row in sheet.iter_rows():
            for cell in row:
                if not isinstance(cell.value, str):
                    continue
                for word in cell.value.split():
                    # A word broken between lines is whole again without spaces, as far as its first line goes.
                    check(word in printed or word[:20] in squeezed, f"{sheet.title}!{cell.coordinate}: {word} is not printed")


def main():
    book_path, _, record_path = sys.argv[1:4]
    with open(record_path, encoding="utf-8") as file:
        record = json.load(file)
    with tempfile.TemporaryDirectory() as folder:
        pages = pages_of(print_to_pdf(book_path, folder), folder)
    texts = [check_page(n, len(pages), size, words, record) for n, (size, words) in enumerate(pages, 1)]
    tables = [text for text in texts if re.search(r"Spacing, c/c", text)]
    check(len(tables) >= len(record["tables"]), f"{len(tables)} pages with tables")
    for text in tables:
        check("bending strength" in text and "Its letter and fill name the limit" in text, "a table page without its legend")
        check("Class" in text and "Load class" in text, "a table page without its heads")
    check_words(openpyxl.load_workbook(book_path), texts)
    print("\n".join(problems[:40]))
    return 1 if problems else 0


sys.exit(main())
