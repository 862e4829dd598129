#!/usr/bin/env python3
# SPDX-License-Identifier: GPL-3.0-or-later
# Writes messages.md from the tables of core/words; run from the top level.
import re
titles=[("reading","Reading a file"),("measuring","Measuring"),("judging","Judging"),("document","Documents"),("book","The job book")]
print("# Remarks and messages\n\nEvery message has a stable code. What stands in braces is filled in. A test compares this page with the program.\n")
for name,title in titles:
    src=open(f"core/words/{name}_sentences.cpp").read()
    body=src[src.index("rows[] = {")+10:]
    rows=re.findall(r'\{\s*((?:"(?:[^"\\]|\\.)*"\s*,?\s*)+)\}',body)
    print(f"## {title}\n\n| code | says | what to do |\n|---|---|---|")
    for row in rows:
        # split at commas between literals
        parts=re.split(r'"\s*,\s*"',row.strip())
        parts=[re.sub(r'"\s*"','',p).strip().strip(',').strip().strip('"') for p in parts]
        parts=[p.replace('\\"','"') for p in parts]
        while len(parts)<3: parts.append("")
        c,t,h=parts[:3]
        print(f"| `{c}` | {t} | {h} |")
    print()
