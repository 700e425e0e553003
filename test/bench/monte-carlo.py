"""Worst reflection of many networks of real parts in vectorised NumPy, complex128, as one would write it: networks down,
frequencies across, so many networks at a time that an array stays in the cache.

usage: monte-carlo.py CASE RESULT
CASE:   JSON: networks, chunk, seed, f0, frequencyHz, source and load (ohm), strayF, arms (source side first: arm, part,
        value, q, seriesH, tolerance)
RESULT: doubles worst[networks]; the seconds of processor time on standard output
"""

import json
import sys
import time

import numpy as np

with open(sys.argv[1]) as file:
    case = json.load(file)
omega = 2 * np.pi * np.array(case["frequencyHz"])
source, load = complex(*case["source"]), complex(*case["load"])
stray = 1j * omega * case["strayF"]
random = np.random.default_rng(case["seed"])


def worst(count):
    """|Γ|² at worst of `count` networks."""
    v = load
    i = 1 + stray * v if case["strayF"] else np.ones(1, complex)
    for arm in reversed(case["arms"]):
        value = arm["value"] * (1 + arm["tolerance"] * random.uniform(-1, 1, (count, 1)))
        if arm["part"] == "inductor":
            # Scaled before it is spread over all frequencies: one multiplication an element.
            z = value * (omega * (1 / arm["q"] + 1j))
        else:
            z = (1 / value) * ((1 / arm["q"] - 1j) / omega)
        if arm["seriesH"]:
            z += 1j * omega * arm["seriesH"]
        if arm["arm"] == "series":
            z *= i
            v = v + z
            if case["strayF"]:
                i = i + stray * v
        else:
            i = i + v / z
    w = i * source.real
    v = v + i * (1j * source.imag) if source.imag else v
    gamma = (v - w) / (v + w)
    return (gamma.real**2 + gamma.imag**2).max(axis=1)


# A fifth of the work to warm up.
for at in range(0, case["networks"] // 5, case["chunk"]):
    worst(case["chunk"])
start = time.process_time()
found = np.empty(case["networks"])
for at in range(0, case["networks"], case["chunk"]):
    found[at : at + case["chunk"]] = worst(min(case["chunk"], case["networks"] - at))
print(time.process_time() - start)
found.tofile(sys.argv[2])
