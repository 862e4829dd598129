# SPDX-License-Identifier: GPL-3.0-or-later
"""The same work as `dampwright-batch measure` with pandas and SciPy, written plain and good.

Reads a run file, cuts it into cycles and speed blocks, averages their loops, reads force and peak
velocity, fits gas and dry friction to the slow block and five damping laws to each direction, with
standard errors and AICc. Needs Debian's python3-pandas and python3-scipy.

  rival.py FILE    figures as JSON on standard output
"""
import io
import json
import sys

import numpy as np
import pandas as pd
from scipy.interpolate import CubicSpline
from scipy.optimize import least_squares
from scipy.signal import find_peaks, savgol_filter

GRID = 720
SLOW = 0.00525  # m/s


def read(source):
    table = pd.read_csv(source)
    t, x, f = (table.iloc[:, i].to_numpy() for i in range(3))
    return t, x * 1e-3, f


def turning_points(x):
    smooth = savgol_filter(x, 25, 3)
    swing = 0.02 * np.ptp(smooth)
    low, _ = find_peaks(-smooth, prominence=swing)
    high, _ = find_peaks(smooth, prominence=swing)
    return centred(smooth, low, high), centred(-smooth, high, low)


def centred(x, low, high):
    """Each lower turning point half way between the crossings of 15 % of the stroke beside it,
    because the extreme sample of a slow sine wanders with the noise. NaN where the motion comes and
    goes unlike: at a rest, or where the speed changes."""
    placed = []
    for i in low:
        k = np.searchsorted(high, i)
        if k == 0 or k == len(high):
            placed.append(np.nan)
            continue
        before, after = high[k - 1], high[k]
        level = x[i] + 0.15 * (min(x[before], x[after]) - x[i])
        left = i - np.argmax(x[before:i + 1][::-1] > level)
        right = i + np.argmax(x[i:after + 1] > level)
        unlike = abs((right - i) - (i - left)) > 0.1 * (right - left)
        placed.append(np.nan if unlike else (left + right) / 2)
    return np.array(placed)


def cycles_of(t, x):
    """Start, top and end sample of each cycle from lower to lower turning point."""
    low, high = turning_points(x)
    cycles = []
    for a, b in zip(low[:-1], low[1:]):
        tops = high[(high > a) & (high < b)]
        if len(tops) == 1 and not np.isnan(a + b):
            ends = x[[round(a), round(b)]]
            cycles.append((a, tops[0], b, x[round(tops[0])] - ends.mean()))
    return cycles


def group(cycles):
    """Neighbouring cycles alike in stroke and period; a rest or a change of speed parts them."""
    groups = []
    for c in cycles:
        if groups:
            last = groups[-1][-1]
            same = (abs((c[2] - c[0]) / (last[2] - last[0]) - 1) < 0.04
                    and abs(c[3] / last[3] - 1) < 0.04 and c[0] == last[2])
            if same:
                groups[-1].append(c)
                continue
        groups.append([c])
    def alone(g):
        period = g[0][2] - g[0][0]
        return len(g) == 1 and any(len(o) > 1 and abs(period / (o[0][2] - o[0][0]) - 1) < 0.5
                                   for o in groups)

    return [g for g in groups if not alone(g)]


def conditioned(groups, t, x):
    first = True
    for g in groups:
        period = (g[0][2] - g[0][0]) * (t[1] - t[0])
        speed = np.pi * g[0][3] / period
        leave = 0 if speed <= SLOW else (4 if first else 1)
        first = first and speed <= SLOW
        yield g[min(leave, len(g) // 3):]


def average(used, rate, splines):
    phase = np.arange(GRID) / GRID
    xs, fs, top = [], [], 0.0
    for a, b, c, _ in used:
        at = a + phase * (c - a)
        cell = (c - a) / GRID / 2
        xs.append((splines[2](at + cell) - splines[2](at - cell)) / (2 * cell))
        fs.append((splines[3](at + cell) - splines[3](at - cell)) / (2 * cell))
        top += (b - a) / (c - a) / len(used)
    period = np.mean([c[2] - c[0] for c in used]) / rate
    x, f = np.mean(xs, axis=0), np.mean(fs, axis=0)
    spectrum = np.fft.rfft(x)
    spectrum[21:] = 0
    noise = np.abs(np.fft.rfft(x))[21:100].mean()
    spectrum[np.abs(spectrum) < 5 * noise] = 0
    spectrum[0] = 0
    frequency = 2j * np.pi * np.arange(len(spectrum)) / period
    v = np.fft.irfft(spectrum * frequency, GRID)
    smooth = np.fft.irfft(spectrum, GRID)
    x = x - (smooth.max() + smooth.min()) / 2 - (x.mean())
    return {"x": x, "v": v, "f": f, "singles": np.array(fs), "period": period, "top": top}


def read_direction(loop, sign):
    i = int(np.argmax(sign * loop["v"]))
    half = int(35 / 360 * GRID)
    window = np.arange(i - half, i + half + 1) % GRID
    s = np.arange(-half, half + 1) / half
    vander = np.vander(s, 5, increasing=True)
    weights = np.linalg.pinv(vander)[0]
    forces = loop["singles"][:, window] @ weights
    error = forces.std(ddof=1) / np.sqrt(len(forces)) if len(forces) > 1 else 0.0
    return {"velocity": sign * loop["v"][i], "force": sign * forces.mean(), "u": error,
            "x": loop["x"][i]}


def energy_of(loop):
    return float(np.sum(loop["f"] * loop["v"]) * loop["period"] / GRID)


def gas_and_friction(loop):
    v, x, f = loop["v"], loop["x"], loop["f"]
    i, k = int(np.argmax(v)), int(np.argmin(v))
    at = np.arange(GRID)
    keep = ((v > 0.02 * v.max()) & (at >= i) & (at < k)) | ((v < -0.02 * v.max()) & (at >= k))
    v, x, f = v[keep], x[keep], f[keep]
    peak = v.max()

    def model(b):
        gas = b[0] * (1 - x * b[1]) ** -1.2
        return gas + b[2] * np.tanh(v / b[3]) + np.where(v > 0, b[4], b[5]) * v - f

    best = None
    for share in (0.02, 0.06, 0.2):
        start = [f.mean(), 0.1, max(1.0, np.ptp(f) / 4), share * peak, 0, 0]
        lower = [-np.inf, -20, 0, 0.005 * peak, -np.inf, -np.inf]
        upper = [np.inf, 20, np.inf, 0.25 * peak, np.inf, np.inf]
        fit = least_squares(model, start, bounds=(lower, upper), x_scale="jac")
        if best is None or fit.cost < best.cost:
            best = fit
    return best.x[0], best.x[1], best.x[2]


def laws_of(v, f):
    def bleed(p):
        opens = p[0] * np.sqrt(p[1])
        flow = v + p[1] / p[2]
        root = np.where(v <= opens, v / p[0],
                        2 * flow / (p[0] + np.sqrt(p[0] ** 2 + 4 * flow / p[2])))
        return root ** 2

    c = f @ v / (v @ v)
    knees = np.sqrt(v[:-1] * v[1:])[:-1]
    laws = {
        "linear": (lambda p: p[0] * v, [[c]]),
        "power": (lambda p: p[0] * v ** p[1], [[c, 1.0]]),
        "two-slope": (lambda p: p[0] * np.minimum(v, p[2]) + p[1] * np.maximum(v - p[2], 0),
                      [[1.5 * c, 0.7 * c, k] for k in knees]),
        "smooth": (lambda p: p[1] * v + (p[0] - p[1]) * p[2] * (1 - np.exp(-v / p[2])),
                   [[1.5 * c, 0.7 * c, k] for k in np.geomspace(v[0], v[-1], 6)]),
        "bleed and blow-off": (bleed, [[k / np.sqrt(c * k), c * k, c] for k in knees]),
    }
    out = {}
    n = len(v)
    for name, (model, starts) in laws.items():
        fits = [least_squares(lambda p: model(p) - f, s, bounds=(1e-9, np.inf), x_scale="jac")
                for s in starts]
        fit = min(fits, key=lambda one: one.cost)
        rss, k = 2 * fit.cost, len(fit.x) + 1
        covariance = np.linalg.pinv(fit.jac.T @ fit.jac) * rss / max(n - len(fit.x), 1)
        aicc = n * np.log(rss / n) + 2 * k + (2 * k * (k + 1) / (n - k - 1) if n > k + 1 else np.inf)
        out[name] = {"parameters": fit.x.tolist(), "errors": np.sqrt(np.diag(covariance)).tolist(),
                     "rms": float(np.sqrt(rss / n)), "aicc": float(aicc)}
    return out


def analyse(t, x, f):
    rate = (len(t) - 1) / (t[-1] - t[0])
    samples = np.arange(len(t), dtype=float)
    place, force = CubicSpline(samples, x), CubicSpline(samples, f)
    splines = (place, force, place.antiderivative(), force.antiderivative())
    blocks = []
    for used in conditioned(group(cycles_of(t, x)), t, x):
        loop = average(used, rate, splines)
        blocks.append((loop, read_direction(loop, 1), read_direction(loop, -1)))
    slow = min(blocks, key=lambda b: b[1]["velocity"])
    gas, inverse, dry = gas_and_friction(slow[0])
    result = {"gas": gas, "dry": dry, "blocks": [], "laws": {}}
    for loop, into, out in blocks:
        result["blocks"].append({"energy": energy_of(loop),
                                 "compression": [into["velocity"], into["force"], into["u"]],
                                 "rebound": [out["velocity"], out["force"], out["u"]]})
    for name, sign, k in (("compression", 1, 1), ("rebound", -1, 2)):
        points = sorted((b[k] for b in blocks), key=lambda p: p["velocity"])
        v = np.array([p["velocity"] for p in points])
        line = np.array([gas * (1 - p["x"] * inverse) ** -1.2 for p in points])
        forces = np.array([p["force"] for p in points]) - sign * line - dry
        result["laws"][name] = laws_of(v, forces)
    return result


def measure(source):
    return analyse(*read(source))


if __name__ == "__main__":
    with open(sys.argv[1], "rb") as file:
        print(json.dumps(measure(io.BytesIO(file.read()))))
