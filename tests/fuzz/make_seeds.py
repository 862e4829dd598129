#!/usr/bin/env python3
# SPDX-License-Identifier: GPL-3.0-or-later
"""Writes tests/fuzz/seeds: one recording of 60 rows in many dialects, for the fuzzers to begin with."""
import math
import pathlib

SEEDS = pathlib.Path(__file__).parent / "seeds"


def rows(between, decimal, clock=lambda t, i: f"{t:.4f}", end="\n"):
    text = ""
    for i in range(60):
        t = i / 200
        cells = [clock(t, i), f"{25 * math.sin(20 * t):.3f}", f"{60 + 800 * math.cos(20 * t):.2f}"]
        text += between.join(c.replace(".", decimal) if ":" not in c else c for c in cells) + end
    return text


def stamp(t, i):
    return f"12:00:{t + 1:06.3f}"


FILES = {
    "comma": ("Time (s),Travel (mm),Load (N)\n" + rows(",", "."), "utf-8"),
    "german": ("Prüfstand;3\nAbtastrate;200 Hz\n\nZeit [s];Weg [mm];Kraft [N]\r\n" + rows(";", ",", end="\r\n"), "cp1252"),
    "french": ("Temps (s);Déplacement (mm);Force (N)\n" + rows(";", ","), "utf-16"),
    "japanese": ("時間(秒),変位(㎜),荷重(N)\n" + rows(",", "."), "cp932"),
    "chinese": ("时间\t位移\t力\n秒\t毫米\t牛\n" + rows("\t", "."), "gb18030"),
    "no_mark": ("Time,Travel,Load\n" + rows(",", "."), "utf-16-be"),
    "blanks": ("# Time (s)  Travel (mm)  Load (N)\n" + rows("   ", "."), "utf-8"),
    "headerless": (rows("|", ".", end="\r"), "utf-8"),
    "clock": ("Time;Travel (mm);Load (N)\n" + rows(";", ".", stamp), "utf-8"),
    "date": ("Time;Travel (mm);Load (N)\n" + rows(";", ".", lambda t, i: "3/4/2031 " + stamp(t, i)), "utf-8"),
    "sections": ("sep=;\nTime (s);Travel (mm);Load (N)\n" + rows(";", ".") + "Step 2\n" + rows(";", ".") + "End\n", "utf-8"),
    "units": ("Time;Travel;Load\n" + rows(" mm;", "."), "utf-8"),
    "counter": ("Sample rate: 200 Hz\nNr;Travel (mm);Load (N)\n" + rows(";", ".", lambda t, i: str(i)), "utf-8"),
    "quoted": ("\"Time, s\",\"Travel \"\"x\"\" (mm)\",\"Load\n(N)\"\n" + rows(",", "."), "utf-8-sig"),
    "thousands": ("Time (ms);Travel (mm);Load (N)\n" + "".join(f"{i};1.5;1'2{i % 10}4.50\n" for i in range(60)), "utf-8"),
    "open": ("Time (ms);Travel (mm);Load (N)\n" + "".join(f"{i};1,234;2,500\n" for i in range(60)), "utf-8"),
}

SEEDS.mkdir(exist_ok=True)
for name, (text, encoding) in FILES.items():
    (SEEDS / f"{name}.csv").write_bytes(text.encode(encoding))
