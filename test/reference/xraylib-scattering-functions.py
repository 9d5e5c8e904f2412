"""Writes xraylib-scattering-functions.csv: F(q,Z) and S(q,Z) of xraylib 4.0.0 at random (Z, q).

Run with Debian's python3-xraylib: /usr/bin/python3 xraylib-scattering-functions.py
Z is uniform on 1..92, q = sin(theta/2)/lambda log-uniform on 0.002..12.1 per angstrom (a photon of
150 keV scattered straight back). Seeded, so the file is the same every time.
"""
import csv
import math
import pathlib
import random

import xraylib

rng = random.Random(20240502)
target = pathlib.Path(__file__).with_name("xraylib-scattering-functions.csv")
with target.open("w", newline="") as out:
    out.write("# xraylib 4.0.0 (Debian 4.0.0+dfsg1), written by xraylib-scattering-functions.py, seed 20240502\n")
    writer = csv.writer(out, lineterminator="\n")
    writer.writerow(["z", "q_per_angstrom", "formFactor", "incoherentScatteringFunction"])
    for _ in range(1000):
        z = rng.randint(1, 92)
        q = round(math.exp(rng.uniform(math.log(0.002), math.log(12.1))), 5)
        writer.writerow([z, q, "%.6e" % xraylib.FF_Rayl(z, q), "%.6e" % xraylib.SF_Compt(z, q)])
