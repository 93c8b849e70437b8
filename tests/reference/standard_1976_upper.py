"""Number densities of the U.S. Standard Atmosphere, 1976, from 86 km to 1000 km.

Solves the six-species equations of the standard (NOAA-S/T 76-1562, section 1.3) and writes the table
that the project interpolates:

    python3 standard_1976_upper.py > ../../src/world/air/standard_1976/upper_table.rs

Python 3.9 or later, standard library alone.

Method. Kinetic temperature, eddy diffusion and gravity are closed forms. Every species obeys a
first-order equation (eq. 36 of the standard) whose coefficients depend only on species worked out before
it: molecular nitrogen first, then atomic and molecular oxygen, which diffuse through nitrogen, then
argon and helium, which diffuse through those three, and last atomic hydrogen (eqs. 37 to 39), which
diffuses through all five. So nothing but quadratures is left. They are done by Simpson's rule on cells of
20 m, whose halves are grid points too; all the heights where a formula switches are ends of cells, and
an integrand that jumps there is taken from inside the cell. Halving the cells moves the values by less
than 1e-9 and the slopes by less than 1e-7 of themselves.

The table holds, by altitude, ln(density), ln(pressure) and their slopes a metre, the slopes by one-sided
differences of fourth order on the fine grid.
"""

import math
import sys

R0 = 6356.766e3  # m, effective radius
G0 = 9.80665  # m/s2
RGAS = 8314.32  # J/(kmol K)
AVOGADRO = 6.022169e26  # 1/kmol
BOLTZMANN = 1.380622e-23  # J/K
M0 = 28.9644  # kg/kmol

CELL = 20.0  # m
HALF = CELL / 2
BOTTOM = 86e3
TOP = 1000e3
STEPS = round((TOP - BOTTOM) / HALF)

# Molar mass kg/kmol, number density at 86 km 1/m3, thermal diffusion alpha, a 1/(m s), b: tables 3, 6, 9.
SPECIES = {
    "N2": (28.0134, 1.129794e20, 0.0, None, None),
    "O": (15.9994, 8.6e16, 0.0, 6.986e20, 0.750),
    "O2": (31.9988, 3.030898e19, 0.0, 4.863e20, 0.750),
    "Ar": (39.948, 1.351400e18, 0.0, 4.487e20, 0.870),
    "He": (4.0026, 7.5817e14, -0.40, 1.700e21, 0.691),
    "H": (1.00797, None, -0.25, 3.305e21, 0.500),
}

# Vertical transport, table 7: Q and q 1/km3, U and u km, W and w 1/km3.
TRANSPORT = {
    "O": (-5.809644e-4, -3.416248e-3, 56.90311, 97.0, 2.706240e-5, 5.008765e-4),
    "O2": (1.366212e-4, 0.0, 86.000, 0.0, 8.333333e-5, 0.0),
    "Ar": (9.434079e-5, 0.0, 86.000, 0.0, 8.333333e-5, 0.0),
    "He": (-2.457369e-4, 0.0, 86.000, 0.0, 6.666667e-4, 0.0),
}

H_AT_500 = 8.0e10  # 1/m3
H_FLUX = 7.2e11  # 1/(m2 s)
H_BOTTOM_KM = 150


def gravity(z):
    return G0 * (R0 / (R0 + z)) ** 2


def temperature(z):
    """Kinetic temperature in K and its slope in K/m, eqs. 25 to 31."""
    km = z / 1e3
    if km <= 91.0:
        return 186.8673, 0.0
    if km <= 110.0:
        x = (km - 91.0) / -19.9429
        root = math.sqrt(1.0 - x * x)
        return 263.1905 - 76.3232 * root, 76.3232 * x / root / -19.9429 / 1e3
    if km <= 120.0:
        return 240.0 + 12.0 * (km - 110.0), 12.0 / 1e3
    ratio = (R0 + 120e3) / (R0 + z)
    fall = (1000.0 - 360.0) * math.exp(-0.01875 * (km - 120.0) * ratio)
    return 1000.0 - fall, fall * 0.01875 * ratio * ratio / 1e3


def eddy(z):
    """Eddy diffusion coefficient in m2/s, eq. 7."""
    km = z / 1e3
    if km < 95.0:
        return 120.0
    if km < 115.0:
        return 120.0 * math.exp(1.0 - 400.0 / (400.0 - (km - 95.0) ** 2))
    return 0.0


def transport(name, z):
    """The fitted v/(D + K) in 1/m, eq. 37."""
    q_big, q_small, u_big, u_small, w_big, w_small = TRANSPORT[name]
    km = z / 1e3
    x = km - u_big
    flux = q_big * x * x * math.exp(-w_big * x**3)
    if q_small != 0.0 and km < u_small:
        y = u_small - km
        flux += q_small * y * y * math.exp(-w_small * y**3)
    return flux / 1e3


def cumulative(rate):
    """Integral of rate(i, middle) over grid points from the bottom; `middle` names the cell."""
    total = [0.0] * (STEPS + 1)
    for i in range(0, STEPS, 2):
        middle = BOTTOM + (i + 1) * HALF
        a, b, c = (rate(i + k, middle) for k in range(3))
        # Simpson's rule, and the same parabola up to the middle of the cell.
        total[i + 1] = total[i] + HALF * (5 * a + 8 * b - c) / 12
        total[i + 2] = total[i] + HALF * (a + 4 * b + c) / 3
    return total


Z = [BOTTOM + i * HALF for i in range(STEPS + 1)]
T, DT = zip(*(temperature(z) for z in Z))
G = [gravity(z) for z in Z]
K = [eddy(z) for z in Z]


def mean_mass_at(middle, above):
    """Mean molar mass: that of mixed air up to 100 km."""
    return M0 if middle < 100e3 else above


def nitrogen():
    mass, start = SPECIES["N2"][:2]

    def rate(i, middle):
        return mean_mass_at(middle, mass) * G[i] / (RGAS * T[i])

    total = cumulative(rate)
    return [start * T[0] / T[i] * math.exp(-total[i]) for i in range(STEPS + 1)]


def diffusing(name, background, mean_mass):
    mass, start, alpha, a, b = SPECIES[name]

    def rate(i, middle):
        diffusion = a / background[i] * (T[i] / 273.15) ** b
        share = diffusion / (diffusion + K[i])
        mean = mean_mass_at(middle, mean_mass[i])
        pull = mass + mean * K[i] / diffusion + alpha * RGAS * DT[i] / G[i]
        return G[i] / (RGAS * T[i]) * share * pull + transport(name, Z[i])

    total = cumulative(rate)
    return [start * T[0] / T[i] * math.exp(-total[i]) for i in range(STEPS + 1)]


def hydrogen(background):
    mass, _, alpha, a, b = SPECIES["H"]
    anchor = round((500e3 - BOTTOM) / HALF)
    fall = cumulative(lambda i, middle: mass * G[i] / (RGAS * T[i]))
    tau = [value - fall[anchor] for value in fall]
    weight = [(T[i] / T[anchor]) ** (1 + alpha) * math.exp(tau[i]) for i in range(STEPS + 1)]
    flow = cumulative(
        lambda i, middle: H_FLUX * weight[i] / (a / background[i] * (T[i] / 273.15) ** b)
    )
    # Above 500 km the standard's table has hydrogen in diffusive equilibrium: no flow counted.
    return [
        (H_AT_500 - min(flow[i] - flow[anchor], 0.0)) / weight[i] for i in range(STEPS + 1)
    ]


def solve():
    n = {}
    n["N2"] = nitrogen()
    only = [SPECIES["N2"][0]] * (STEPS + 1)
    n["O"] = diffusing("O", n["N2"], only)
    n["O2"] = diffusing("O2", n["N2"], only)
    three = ("N2", "O", "O2")
    heavy = [sum(n[s][i] for s in three) for i in range(STEPS + 1)]
    mean = [sum(n[s][i] * SPECIES[s][0] for s in three) / heavy[i] for i in range(STEPS + 1)]
    n["Ar"] = diffusing("Ar", heavy, mean)
    n["He"] = diffusing("He", heavy, mean)
    n["H"] = hydrogen([heavy[i] + n["Ar"][i] + n["He"][i] for i in range(STEPS + 1)])
    return n


# Ends of the table's segments and their steps, km. At 100 km the slopes of the number densities jump, at
# 110 km the second one of temperature, and hydrogen counts from 150 km. Within a segment the cubic
# through values and slopes misses the solution by less than 2e-6.
SEGMENTS = [
    (86, 100, 0.5),
    (100, 110, 0.25),
    (110, 120, 0.5),
    (120, 150, 1),
    (150, 300, 3),
    (300, 1000, 14),
]


def logarithms(n, low, i, inside):
    """ln(density), its slope, ln(pressure), its slope; slopes by differences from one side."""
    present = [s for s in n if s != "H" or low >= H_BOTTOM_KM]

    def at(k):
        number = sum(n[s][k] for s in present)
        mass = sum(n[s][k] * SPECIES[s][0] for s in present) / AVOGADRO
        # The formulas of temperature miss each other by 1e-6 at 110 km: take the one from inside.
        mass *= T[k] / temperature(Z[k] + sign * 1e-6)[0]
        return math.log(mass), math.log(number * BOLTZMANN * T[k])

    sign = 1 if inside else -1
    values = [at(i + sign * k) for k in range(5)]
    row = []
    for part in range(2):
        f = [value[part] for value in values]
        slope = (-25 * f[0] + 48 * f[1] - 36 * f[2] + 16 * f[3] - 3 * f[4]) / (12 * HALF * sign)
        row += [f[0], slope]
    return row


def main():
    n = solve()
    out = sys.stdout
    out.write("//! Generated by `tests/reference/standard_1976_upper.py`; do not edit.\n\n")
    out.write("use super::upper::Segment;\n\n")
    out.write("#[rustfmt::skip]\npub(super) const SEGMENTS: [Segment; %d] = [\n" % len(SEGMENTS))
    for low, high, step in SEGMENTS:
        out.write("    Segment { bottom: %.1f, step: %.1f, rows: &[\n" % (low * 1e3, step * 1e3))
        count = round((high - low) / step)
        for k in range(count + 1):
            i = round(((low + k * step) * 1e3 - BOTTOM) / HALF)
            out.write("        [%.10f, %.9e, %.10f, %.9e],\n" % tuple(logarithms(n, low, i, k < count)))
        out.write("    ] },\n")
    out.write("];\n")


if __name__ == "__main__":
    main()
