# SPDX-License-Identifier: GPL-3.0-or-later
"""How fast: `dampwright-batch measure` against rival.py (pandas and SciPy) on one run of 300,000
rows. Both sides' figures are compared before any time is printed.

  measure_speed.py DIRECTORY_OF_PROGRAMS [repeats]    exit status 1 where the figures disagree

Prints whole process against whole process (median of the repeats, taken by turns), and from bytes
in memory (our reading and measuring against the rival's; no process start, no imports).
"""
import io
import json
import pathlib
import statistics
import subprocess
import sys
import tempfile
import time

import numpy as np

import rival

ROWS = 300_000
RATE = 2000.0
HERE = pathlib.Path(__file__).parent


def made_run():
    """Sines of 50 mm: 5 mm/s, then 50 to 1000 mm/s; gas 160 N, friction 24 N, two slopes."""
    rng = np.random.default_rng(7)
    rest = np.full(1000, -0.025)
    x, v = [rest], [0 * rest]

    def block(speed, cycles):
        omega = speed / 0.025
        t = np.arange(int(round(cycles * 2 * np.pi / omega * RATE))) / RATE
        x.append(-0.025 * np.cos(omega * t))
        v.append(speed * np.sin(omega * t))
        x.append(rest)
        v.append(0 * rest)

    speeds = [0.05, 0.1, 0.2, 0.3, 0.5, 0.7, 1.0]
    block(0.005, 3)
    slow_rows = sum(len(one) for one in x)
    per_cycle = sum(2 * np.pi * 0.025 / s * RATE for s in speeds)
    cycles = (ROWS - slow_rows - 1000 * len(speeds)) / per_cycle
    for speed in speeds:
        block(speed, int(cycles))
    x, v = np.concatenate(x), np.concatenate(v)
    missing = max(0, ROWS - len(x))
    x, v = np.append(x, np.full(missing, -0.025))[:ROWS], np.append(v, np.zeros(missing))[:ROWS]
    low, high, knee = np.where(v > 0, 1800, 4200), np.where(v > 0, 500, 1300), 0.12
    law = low * np.minimum(np.abs(v), knee) + high * np.maximum(np.abs(v) - knee, 0)
    force = 160 * (1 - x / 0.5) ** -1.2 + 24 * np.tanh(v / 3e-4) + np.sign(v) * law
    force += rng.normal(0, 2, ROWS)
    x = x + rng.normal(0, 1e-5, ROWS)
    lines = ["Time (s),Displacement (mm),Force (N)"]
    lines += [f"{i / RATE:.4f},{1e3 * a:.4f},{b:.3f}" for i, (a, b) in enumerate(zip(x, force))]
    return "\n".join(lines) + "\n"


def close(name, ours, theirs, limit):
    good = abs(ours - theirs) <= limit
    if not good:
        print(f"DISAGREE {name}: {ours:.6g} against {theirs:.6g}")
    return good


def agree(ours, theirs):
    """Peak velocities and energies to 0.1 %, forces to 1 N or 0.3 %, gas and friction to 1 N, and
    the law with the lowest AICc."""
    moving = [b for b in ours["blocks"] if b["kind"] != "hold"]
    good = close("blocks", len(moving), len(theirs["blocks"]), 0)
    for mine, other in zip(moving, theirs["blocks"]):
        good &= close("energy", mine["energy_j"], other["energy"], 1e-3 * other["energy"] + 0.02)
        for direction in ("compression", "rebound"):
            velocity, force, _ = other[direction]
            read = mine[direction]
            good &= close("velocity", read["peak_velocity_mm_s"] / 1e3, velocity, 1e-3 * velocity)
            good &= close("force", read["force_n"], force, max(1, 3e-3 * abs(force)))
    good &= close("gas", ours["gas"]["force_n"], theirs["gas"], 1)
    good &= close("dry friction", ours["friction"]["dry_n"], theirs["dry"], 1)
    for direction in ("compression", "rebound"):
        chosen = next(law["law"] for law in ours["laws"][direction] if law["chosen"])
        laws = theirs["laws"][direction]
        lowest = min(laws, key=lambda name: laws[name]["aicc"])
        if chosen != lowest:
            print(f"DISAGREE law in {direction}: {chosen} against {lowest}")
            good = False
        names = ["low_n_s_per_m", "high_n_s_per_m"]
        for mine in ours["laws"][direction]:
            if mine["law"] == "two-slope":
                for name, value in zip(names, laws["two-slope"]["parameters"]):
                    good &= close(name, mine["parameters"][name], value, 5e-3 * value)
    return good


def timed(command):
    start = time.perf_counter()
    done = subprocess.run(command, capture_output=True, check=True)
    return time.perf_counter() - start, done.stdout


def in_memory(data):
    start = time.perf_counter()
    rival.measure(io.BytesIO(data))
    return time.perf_counter() - start


def main():
    programs = pathlib.Path(sys.argv[1])
    repeats = int(sys.argv[2]) if len(sys.argv) > 2 else 7
    with tempfile.TemporaryDirectory() as folder:
        run = pathlib.Path(folder) / "run.csv"
        run.write_text(made_run())
        data = run.read_bytes()
        ours, theirs, memory_ours, memory_theirs = [], [], [], []
        for _ in range(repeats):
            seconds, mine = timed([programs / "dampwright-batch", "measure", run])
            ours.append(seconds)
            seconds, other = timed([sys.executable, HERE / "rival.py", run])
            theirs.append(seconds)
            memory_ours.append(float(timed([programs / "bench_measure_memory", run])[1]))
            memory_theirs.append(in_memory(data))
        good = agree(json.loads(mine), json.loads(other))
    print("figures agree" if good else "FIGURES DISAGREE")
    for name, a, b, target in (("whole process", ours, theirs, 20),
                               ("from bytes in memory", memory_ours, memory_theirs, 10)):
        mine, other = statistics.median(a), statistics.median(b)
        print(f"{name}: ours {1e3 * mine:.0f} ms, pandas + SciPy {1e3 * other:.0f} ms, "
              f"{other / mine:.1f} x (target {target} x)")
    return 0 if good else 1


if __name__ == "__main__":
    sys.exit(main())
