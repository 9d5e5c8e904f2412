"""Numbers of the worked examples, computed without any of Stratabeam's code.

Reads the case files as data and, for every technique at the size P50, computes
  half-value layer   of the beam behind tube and added filter, vacuum, mm aluminium
  transmission       of the patient by air kerma, narrow beam
  subject contrast   of the detail by detected primary signal, centre of the detail
with numpy and xraylib (total cross sections with coherent scatter, jump ratios, fluorescence yields,
line energies). From published descriptions come the tube model's closed form, the compositions of
compositions.csv beside this file, and the volumes that agents take. The inherent filter is found by
bisection from the one reading nearest 80 kV without added filter, not fitted to all readings.

    python3 examples-independent.py > examples-independent.csv

Debian packages: python3-numpy, python3-xraylib.
"""

import csv
import json
import math
import os

import numpy as np
import xraylib as xrl

here = os.path.dirname(os.path.abspath(__file__))
examples = os.path.join(here, "..", "..", "components", "examples")

# ---- matter: a dict of mass fractions by Z, and a density in g/cm3 -----------------------------

REFERENCE_NAMES = {
    "soft tissue": "tissue_soft_icru44",
    "adipose": "adipose_icru44",
    "muscle": "muscle_skeletal_icru44",
    "blood": "blood_whole_icru44",
    "cortical bone": "bone_cortical_icru44",
    "spongiosa": "spongiosa_icru46",
    "water": "water",
    "air": "air",
}
DENSITIES = {"aluminium": ("Al", 2.699), "copper": ("Cu", 8.96), "lead": ("Pb", 11.35),
             "carbon fibre": ("C", 1.6)}


def read_compositions():
    fractions, densities = {}, {}
    with open(os.path.join(here, "compositions.csv"), newline="") as f:
        for row in csv.DictReader(f):
            if row["set"] == "composition":
                name, symbol = row["item"].rsplit(":", 1)
                z = xrl.SymbolToAtomicNumber(symbol)
                fractions.setdefault(name, {})[z] = float(row["value"])
            else:
                densities[row["item"]] = float(row["value"])
    return fractions, densities


FRACTIONS, DENSITY_OF = read_compositions()


def formula(text, density):
    parsed = xrl.CompoundParser(text)
    return dict(zip(parsed["Elements"], parsed["massFractions"])), density


def material(case, name):
    for own in case["materials"]:
        if own["name"] == name:
            by_z = {xrl.SymbolToAtomicNumber(s): w for s, w in own["massFractions"].items()}
            return normalised(by_z), own["density_g_per_cm3"]
    if name in DENSITIES:
        symbol, density = DENSITIES[name]
        return {xrl.SymbolToAtomicNumber(symbol): 1.0}, density
    if name == "lung":
        return normalised(FRACTIONS["lung_icru44"]), DENSITY_OF["lung_inflated"]
    if name == "cotton fibre":
        return formula("C6H10O5", 0.7)
    if name == "caesium iodide":
        return formula("CsI", 4.51)
    reference = REFERENCE_NAMES[name]
    return normalised(FRACTIONS[reference]), DENSITY_OF[reference]


def normalised(fractions):
    total = sum(fractions.values())
    return {z: w / total for z, w in fractions.items()}


# Molecule, and the volume that one gram of it takes in its carrier (mL).
AGENTS = {
    "iodine": ("C19H26I3N3O9", 0.46),
    "barium sulfate": ("BaSO4", 1 / 4.5),
    "gadolinium chelate": ("C28H54GdN5O20", 0.58),
}
ELEMENT = {"iodine": "I", "barium sulfate": "Ba", "gadolinium chelate": "Gd"}


def in_carrier(case, agent, carrier):
    molecule, volume = AGENTS[agent["name"]]
    solute, _ = formula(molecule, 1)
    value, unit = agent["amount"]["value"], agent["amount"]["unit"]
    if unit == "% w/v":
        solute_g = value / 100
    elif unit == "mmol/mL":
        solute_g = value / 1000 * xrl.CompoundParser(molecule)["molarMass"]
    else:
        solute_g = value / 1000 / solute[xrl.SymbolToAtomicNumber(ELEMENT[agent["name"]])]
    fractions, density = material(case, agent["carrier"] or carrier)
    carrier_g = density * (1 - solute_g * volume)
    mass = {z: w * carrier_g for z, w in fractions.items()}
    for z, w in solute.items():
        mass[z] = mass.get(z, 0) + w * solute_g
    return normalised(mass), carrier_g + solute_g


def layer_matter(case, layer):
    if layer.get("agent"):
        return in_carrier(case, layer["agent"], layer["material"])
    return material(case, layer["material"])


def linear(matter, energies):
    """Linear attenuation in 1/cm."""
    fractions, density = matter
    return density * np.array(
        [sum(w * xrl.CS_Total(z, float(e)) for z, w in fractions.items()) for e in energies]
    )


# ---- tube: closed form of the model, 0.25 keV midpoints, K lines at their energies ---------------

Y = [[1.2714, 0.1686, -0.1746], [-1.5703, -3.0038, 1.3423], [4.1455, 12.2542, -4.7107],
     [-6.6776, -27.6326, 7.3474], [6.0150, 30.1045, -4.8798], [-1.8395, -12.7648, 0.9433]]
LINES = [(59.318, 0.50243), (57.981, 0.28917), (67.244, 0.10808), (66.950, 0.05588),
         (69.077, 0.03859)]


def tube(kv, angle_deg):
    """Energies in keV and photons in each channel (any scale), before every filter."""
    step = 0.25
    energies = np.arange(9 + step / 2, kv, step)
    sine = math.sin(math.radians(angle_deg))
    l = math.log(kv / 100)
    r0 = math.exp(-3.52099 + 1.61478 * l - 0.04537 * l**2 - 0.01497 * l**3)
    m = np.array([xrl.CS_Total(74, float(e)) for e in energies])
    u = energies / kv
    v = 1 - u
    y = sum(u**i * (a[0] + a[1] * l + a[2] * l * l) for i, a in enumerate(Y))
    zeta = (r0 * v / (0.3687 + 4.1592 * np.sqrt(v) + 2.2941 * v)
            * np.exp(l * (-0.1050 + 0.0589 * v)))
    kappa = 1.6758 - 0.2295 * v**4
    photons = 1e-5 * y * (kv - energies) / energies * (1 + m * zeta / (kappa * sine)) ** -kappa * step
    if kv < 69.7:
        return energies, photons
    big_l, w, x = math.log(kv / 69.525 - 1), 1 - 69.525 / kv, (kv - 100) / 100
    v_d = math.exp(-7.2856 + 1.5222 * big_l - 0.0795 * big_l**2)
    v_i = math.exp(-6.5690 + 1.6173 * big_l - 0.0482 * big_l**2)
    z_d = r0 * w / (-0.3249 + 7.9374 * math.sqrt(w))
    z_i = 0.05781 + 0.04863 * x - 0.00951 * x * x
    lines = []
    for energy, share in LINES:
        m = xrl.CS_Total(74, energy)
        lines.append(0.9538 * share / (4 * math.pi) * (
            v_d * (1 + m * z_d / (1.7 * sine)) ** -1.7
            + v_i * (1 + m * z_i / (0.6456 * sine)) ** -0.6456))
    return np.append(energies, [e for e, _ in LINES]), np.append(photons, lines)


# ---- air kerma ---------------------------------------------------------------------------------

def kerma_weight(energies):
    """E * mu_en/rho of air (any scale): photoelectric plus bound Compton energy transfer."""
    fractions, _ = material({"materials": []}, "air")
    theta = (np.arange(180) + 0.5) * math.pi / 180
    weights = []
    for e in energies:
        e = float(e)
        ratio = 1 / (1 + e / 510.998950 * (1 - np.cos(theta)))
        total = 0.0
        for z, w in fractions.items():
            d = np.array([xrl.DCS_Compt(z, e, float(t)) for t in theta]) * np.sin(theta)
            transferred = np.sum(d * (1 - ratio)) / np.sum(d)
            total += w * (xrl.CS_Photo(z, e) + xrl.CS_Compt(z, e) * transferred)
        weights.append(e * total)
    return np.array(weights)


def half_value_layer_mm(energies, photons, weight):
    mu = linear(material({"materials": []}, "aluminium"), energies)
    start = np.sum(photons * weight)
    low, high = 0.0, 50.0
    for _ in range(60):
        middle = (low + high) / 2
        passed = np.sum(photons * weight * np.exp(-mu * middle / 10))
        low, high = (middle, high) if passed > start / 2 else (low, middle)
    return (low + high) / 2


# ---- detector: energy absorbed per photon, K photons that escape taken off -----------------------

K_LINES = [xrl.KA1_LINE, xrl.KA2_LINE, xrl.KB1_LINE, xrl.KB2_LINE, xrl.KB3_LINE]


def absorbed_keV(case, energies):
    detector = case["room"]["detector"]
    fractions, _ = material(case, detector["material"])
    areal = detector["arealDensity_mg_per_cm2"] / 1000
    depth = (np.arange(200) + 0.5) / 200 * areal
    cosines = (np.arange(100) + 0.5) / 100
    total = lambda e: sum(w * xrl.CS_Total(z, float(e)) for z, w in fractions.items())
    result = []
    for e in energies:
        mu = total(e)
        interacting = 1 - math.exp(-mu * areal)
        where = np.exp(-mu * depth)
        where /= where.sum()
        lost = 0.0
        for z, w in fractions.items():
            if e <= xrl.EdgeEnergy(z, xrl.K_SHELL):
                continue
            k_share = 1 - 1 / xrl.JumpFactor(z, xrl.K_SHELL)
            vacancies = w * xrl.CS_Photo(z, float(e)) * k_share * xrl.FluorYield(z, xrl.K_SHELL) / mu
            rates = np.array([xrl.RadRate(z, line) for line in K_LINES])
            for line, rate in zip(K_LINES, rates / rates.sum()):
                energy = xrl.LineEnergy(z, line)
                inside = total(energy)
                out = np.array([
                    0.5 * np.mean(np.exp(-inside * d / cosines)
                                  + np.exp(-inside * (areal - d) / cosines)) for d in depth])
                lost += vacancies * rate * energy * np.sum(where * out)
        result.append(interacting * (e - lost))
    return np.array(result)


# ---- a technique -------------------------------------------------------------------------------

def slabs_exponent(case, slabs, energies):
    return sum((linear(material(case, s["material"]), energies) * s["thickness_mm"] / 10
                for s in slabs), np.zeros(len(energies)))


def inherent_mm(case):
    room = case["room"]
    open_beam = [r for r in room["readings"] if r["filter"] == "none"]
    reading = min(open_beam, key=lambda r: abs(r["potential_kV"] - 80))
    energies, photons = tube(reading["potential_kV"], room["tube"]["anodeAngle_deg"])
    weight = kerma_weight(energies)
    air = linear(material(case, "air"), energies) * reading["distance_mm"] / 10
    aluminium = linear(material(case, "aluminium"), energies)
    low, high = 0.5, 10.0
    for _ in range(40):
        middle = (low + high) / 2
        beam = photons * np.exp(-air - aluminium * middle / 10)
        reached = half_value_layer_mm(energies, beam, weight)
        low, high = (middle, high) if reached < reading["halfValueLayer_mmAl"] else (low, middle)
    return (low + high) / 2


def grown(case, thickness_mm):
    layers = case["patient"]["layers"]
    change = thickness_mm - sum(layer["thickness_mm"] for layer in layers)
    return [layer["thickness_mm"] + layer["growthShare"] * change for layer in layers]


def grid_transmission(case, technique, energies):
    if technique["grid"] == "out":
        return np.ones(len(energies))
    grid = case["room"]["grid"]
    pitch = 10 / grid["strips_per_cm"]
    strip = grid["strip"]["thickness_um"] / 1000
    height = grid["ratio"] * (pitch - strip)
    part = lambda name: np.exp(-linear(material(case, name), energies) * height / 10)
    through = (strip * part(grid["strip"]["material"])
               + (pitch - strip) * part(grid["interspace"]["material"])) / pitch
    return through * np.exp(-slabs_exponent(case, grid["cover"], energies))


def detail_exponents(case, detail, layer, energies):
    """Attenuation of the detail and of its reference, over the path the detail takes."""
    path_cm = detail["size_mm"] * (detail.get("walls", 1) if detail["shape"] == "coat" else 1) / 10
    if detail["shape"] == "defect":
        matter = material(case, detail["material"])
    elif detail.get("agent"):
        matter = in_carrier(case, detail["agent"], "blood")
    else:
        matter = material(case, detail["material"])
    name = detail.get("reference", "layer")
    reference = layer_matter(case, layer) if name == "layer" else material(case, name)
    return linear(matter, energies) * path_cm, linear(reference, energies) * path_cm, path_cm


def run(case, technique, inherent):
    room, geometry = case["room"], case["room"]["geometry"]
    energies, photons = tube(technique["potential_kV"], room["tube"]["anodeAngle_deg"])
    weight = kerma_weight(energies)
    added = next(f for f in room["filters"] if f["name"] == technique["filter"])
    beam = photons * np.exp(-linear(material(case, "aluminium"), energies) * inherent / 10
                            - slabs_exponent(case, added["layers"], energies))
    median = next(s for s in case["patient"]["sizes"] if s["name"] == "P50")["thickness_mm"]
    layers, thicknesses = case["patient"]["layers"], grown(case, median)
    change = median - sum(layer["thickness_mm"] for layer in layers)
    moved = {"detector": 0, "table": change, "isocentre": change / 2}[geometry["anchor"]]
    gap = geometry["exitToDetector_mm"] - moved
    skin_mm = geometry["sourceToDetector_mm"] - gap - median
    before = [s for s in room["support"] if s["side"] == "entrance"]
    after = [s for s in room["support"] if s["side"] == "exit"]
    air = linear(material(case, "air"), energies)
    free = lambda length, slabs: max(0, length - sum(s["thickness_mm"] for s in slabs)) / 10
    skin = beam * np.exp(-slabs_exponent(case, before, energies) - air * free(skin_mm, before))
    patient = sum(linear(layer_matter(case, layer), energies) * t / 10
                  for layer, t in zip(layers, thicknesses))
    leaving = skin * np.exp(-patient)
    transmission = np.sum(leaving * weight) / np.sum(skin * weight)

    detail = case["task"]["detail"]
    layer = next(x for x in layers if x["name"] == detail["inLayer"])
    own, reference, path_cm = detail_exponents(case, detail, layer, energies)
    replaced = linear(layer_matter(case, layer), energies) * path_cm
    read = (leaving * np.exp(-slabs_exponent(case, after, energies) - air * free(gap, after))
            * grid_transmission(case, technique, energies) * absorbed_keV(case, energies))
    background = np.sum(read * np.exp(replaced - reference))
    behind_detail = np.sum(read * np.exp(replaced - own))
    return [
        ("half-value layer", "mm Al", half_value_layer_mm(energies, beam, weight)),
        ("transmission", "", transmission),
        ("subject contrast", "", 1 - behind_detail / background),
    ]


print("# Written by examples-independent.py: numpy %s, xraylib %s" % (np.__version__, xrl.__version__))
print("example,technique,size,quantity,unit,value")
for name in ["aortography", "chest-line", "barium", "barium-coat", "gadolinium"]:
    with open(os.path.join(examples, name + ".case.json")) as f:
        example = json.load(f)
    filtration = inherent_mm(example)
    print("%s,,,inherent filter,mm Al,%.4g" % (name, filtration))
    for chosen in example["techniques"]:
        for quantity, unit, value in run(example, chosen, filtration):
            print('%s,"%s",P50,%s,%s,%.5g' % (name, chosen["name"], quantity, unit, value))
