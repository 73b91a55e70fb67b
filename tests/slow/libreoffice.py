#!/usr/bin/python3
"""Opens a workbook in LibreOffice and prints its cells as JSON: {sheet: {address: number, text or {"error": code}}}.

    libreoffice.py FILE [FREEZE.json] [SAVE.xlsx]

FREEZE.json ({sheet: {address: number or text}}) replaces cells by constants first, then everything is calculated anew.
Runs under the system's Python, to which LibreOffice's bindings belong.
"""
import json
import os
import shutil
import subprocess
import sys
import tempfile
import time

import uno
from com.sun.star.beans import PropertyValue
from com.sun.star.sheet.FormulaResult import STRING

PIPE = f"stillwall{os.getpid()}"


def prop(name, value):
    item = PropertyValue()
    item.Name, item.Value = name, value
    return item


def connect(profile):
    office = subprocess.Popen(
        ["soffice", "--headless", "--norestore", "--nologo", f"-env:UserInstallation=file://{profile}",
         f"--accept=pipe,name={PIPE};urp;"], stdout=subprocess.DEVNULL, stderr=subprocess.DEVNULL)
    local = uno.getComponentContext()
    resolver = local.ServiceManager.createInstanceWithContext("com.sun.star.bridge.UnoUrlResolver", local)
    for _ in range(240):
        try:
            return office, resolver.resolve(f"uno:pipe,name={PIPE};urp;StarOffice.ComponentContext")
        except Exception:
            time.sleep(0.5)
    office.kill()
    sys.exit("LibreOffice did not start")


def cells_of(sheet):
    cursor = sheet.createCursor()
    cursor.gotoEndOfUsedArea(False)
    area = cursor.RangeAddress
    found = {}
    for row in range(area.EndRow + 1):
        for column in range(area.EndColumn + 1):
            cell = sheet.getCellByPosition(column, row)
            if cell.Type.value == "EMPTY":
                continue
            address = cell.AbsoluteName.rsplit(".", 1)[1].replace("$", "")
            if cell.getError():
                found[address] = {"error": cell.String}
            elif cell.Type.value == "TEXT" or (cell.Type.value == "FORMULA" and cell.FormulaResultType2 == STRING):
                found[address] = cell.String
            else:
                found[address] = cell.Value
    return found


def freeze(document, frozen):
    for name, cells in frozen.items():
        sheet = document.Sheets.getByName(name)
        sheet.unprotect("")
        for address, value in cells.items():
            cell = sheet.getCellRangeByName(address)
            if isinstance(value, str):
                cell.String = value
            else:
                cell.Value = value
    document.calculateAll()


def main(file, frozen=None, save=None):
    folder = tempfile.mkdtemp()
    office, context = connect(os.path.join(folder, "profile"))
    try:
        desktop = context.ServiceManager.createInstanceWithContext("com.sun.star.frame.Desktop", context)
        document = desktop.loadComponentFromURL(uno.systemPathToFileUrl(os.path.abspath(file)), "_blank", 0, (prop("Hidden", True),))
        if frozen:
            with open(frozen, encoding="utf-8") as text:
                freeze(document, json.load(text))
        sheets = document.Sheets
        contents = {sheets.getByIndex(i).Name: cells_of(sheets.getByIndex(i)) for i in range(sheets.Count)}
        kept = {
            "charts": sum(sheets.getByIndex(i).Charts.Count for i in range(sheets.Count)),
            "comments": sum(sheets.getByIndex(i).Annotations.Count for i in range(sheets.Count)),
            "names": document.NamedRanges.Count,
            "protected": [sheets.getByIndex(i).Name for i in range(sheets.Count) if sheets.getByIndex(i).isProtected()],
            "pictures": sum(1 for i in range(sheets.Count) for j in range(sheets.getByIndex(i).DrawPage.Count)
                            if sheets.getByIndex(i).DrawPage.getByIndex(j).supportsService("com.sun.star.drawing.GraphicObjectShape")),
            "conditions": sum(sheets.getByIndex(i).ConditionalFormats.getLength() for i in range(sheets.Count)),
        }
        print(json.dumps({"cells": contents, "kept": kept}))
        if save:
            document.storeToURL(uno.systemPathToFileUrl(os.path.abspath(save)), (prop("FilterName", "Calc MS Excel 2007 XML"),))
        document.close(True)
        desktop.terminate()
    finally:
        try:
            office.wait(60)
        except subprocess.TimeoutExpired:
            office.kill()
        shutil.rmtree(folder, ignore_errors=True)


main(*sys.argv[1:])
