"""Prints F(q,Z) and S(q,Z) of xraylib at the nodes named on the command line.

One line an element, Z = 1 to 92: F at every node, then S at every node, five digits.
The nodes are those of the published tables, where xraylib returns the tabulated value itself.
"""
import sys

import xraylib

nodes = [float(text) for text in sys.argv[1:]]
for z in range(1, 93):
    values = [xraylib.FF_Rayl(z, q) for q in nodes] + [xraylib.SF_Compt(z, q) for q in nodes]
    print(" ".join("%.4e" % value for value in values))
