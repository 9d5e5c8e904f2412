"""Writes xraylib-cross-sections.csv: 2000 cross sections of xraylib 4.0.0 at random (Z, E).

Photoelectric twice: CS_Photo passes through the nodes of XCOM by a spline of xraylib's own;
CS_Photo_Total is a separate calculation (Kissel, Scofield) on a dense grid, empty where it ends.

Run with Debian's python3-xraylib: /usr/bin/python3 xraylib-cross-sections.py
Z is uniform on 1..92, E log-uniform on 1 keV..800 keV, where xraylib tabulates all three
processes; pairs closer than 1e-3 relative to an absorption edge are drawn again, because the two
tables may place the edge itself differently. Seeded, so the file is the same every time.
"""
import csv
import math
import pathlib
import random

import xraylib

SHELLS = range(0, 9)  # K, L1-L3, M1-M5
rng = random.Random(20240501)


def near_edge(z, energy):
    for shell in SHELLS:
        try:
            edge = xraylib.EdgeEnergy(z, shell)
        except ValueError:
            continue
        if edge > 0 and abs(energy / edge - 1) < 1e-3:
            return True
    return False


def photo_dense(z, energy):
    try:
        value = xraylib.CS_Photo_Total(z, energy)
    except ValueError:
        return ""
    # Beyond its grid xraylib extrapolates this table without a warning.
    return "%.6e" % value if 0.9 < value / xraylib.CS_Photo(z, energy) < 1.1 else ""


rows = []
while len(rows) < 2000:
    z = rng.randint(1, 92)
    energy = round(math.exp(rng.uniform(math.log(1.0), math.log(800.0))), 4)
    if near_edge(z, energy):
        continue
    rows.append([z, "%.4f" % energy] + ["%.6e" % f(z, energy) for f in (
        xraylib.CS_Rayl, xraylib.CS_Compt, xraylib.CS_Photo)] + [photo_dense(z, energy)])

target = pathlib.Path(__file__).with_name("xraylib-cross-sections.csv")
with target.open("w", newline="") as out:
    out.write("# xraylib 4.0.0 (Debian 4.0.0+dfsg1), written by xraylib-cross-sections.py, seed 20240501\n")
    writer = csv.writer(out, lineterminator="\n")
    writer.writerow(["z", "energy_keV", "coherent_cm2_per_g", "incoherent_cm2_per_g",
                     "photoelectric_cm2_per_g", "photoelectricDense_cm2_per_g"])
    writer.writerows(rows)
