"""Makes numbers.json: high-precision references for collision, stability ratio, wells and layers.

Independent of the program: mpmath, 30 digits, tanh-sinh or Gauss quadrature of the plain integrals.
Run in this folder: /usr/bin/python3 makeNumbers.py
"""
import json

import mpmath as mp

mp.mp.dps = 30

# CODATA 2018
BOLTZMANN = mp.mpf('1.380649e-23')
CHARGE = mp.mpf('1.602176634e-19')
AVOGADRO = mp.mpf('6.02214076e23')
EPSILON0 = mp.mpf('8.8541878128e-12')
CONTACT = mp.mpf('0.165e-9')


def honig(u):
    return (6 * u * u + 13 * u + 2) / (6 * u * u + 4 * u)


def bispherical(u):
    """Resistance of two equal spheres approaching along their line of centres, over Stokes' (mirror plane at half the gap)."""
    u = mp.mpf(u)
    alpha = mp.acosh(1 + u / 2)
    s2 = mp.sinh(alpha) ** 2

    def term(n):
        n = mp.mpf(n)
        top = 4 * mp.cosh((n + mp.mpf(1) / 2) * alpha) ** 2 + (2 * n + 1) ** 2 * s2
        bottom = 2 * mp.sinh((2 * n + 1) * alpha) - (2 * n + 1) * mp.sinh(2 * alpha)
        return n * (n + 1) / ((2 * n - 1) * (2 * n + 3)) * (top / bottom - 1)

    total, n = mp.mpf(0), 1
    while True:
        t = term(n)
        total += t
        if n > 10 and abs(t) < mp.mpf('1e-22') * abs(total):
            break
        n += 1
    return mp.mpf(4) / 3 * mp.sinh(alpha) * total


def hamaker(h, a1, a2):
    """V/A of two spheres; 30 digits make the cancellation harmless."""
    inner = h * h + 2 * (a1 + a2) * h
    outer = inner + 4 * a1 * a2
    return -(2 * a1 * a2 / inner + 2 * a1 * a2 / outer + mp.log(inner / outer)) / 6


class Curve:
    """Hamaker attraction and superposed double layers; unlike spheres after Derjaguin; SI."""

    def __init__(self, a1, a2, A, psi, salt, T='298.15', eps='78.3'):
        self.a1, self.a2, self.A = mp.mpf(a1), mp.mpf(a2), mp.mpf(A)
        self.kT = BOLTZMANN * mp.mpf(T)
        eps = mp.mpf(eps) * EPSILON0
        self.kappa = mp.sqrt(2 * AVOGADRO * CHARGE**2 * mp.mpf(salt) / (eps * self.kT))
        gamma = mp.tanh(CHARGE * mp.mpf(psi) / (4 * self.kT))
        mean = 2 * self.a1 * self.a2 / (self.a1 + self.a2)
        self.mean = mean
        self.repulsion = 32 * mp.pi * eps * mean * (self.kT / CHARGE) ** 2 * gamma**2 / self.kT

    def __call__(self, h):
        return self.A / self.kT * hamaker(h, self.a1, self.a2) + self.repulsion * mp.exp(-self.kappa * h)


def ln_w(v, contact, places):
    """Fuchs with the Honig factor, in x = ln h between the given gaps, then out to infinity with the substitution 1/h."""
    s = v.a1 + v.a2
    top = max(v(h) for h in places)

    def f(x):
        h = mp.exp(x)
        return s * honig(h / v.mean) * mp.exp(v(h) - top) / (s + h) ** 2 * h

    points = [mp.log(contact)] + [mp.log(p) for p in places if p > contact]
    inner = mp.quad(f, points, maxdegree=10)
    last = max(places)
    outer = mp.quad(lambda y: s * honig(1 / (y * v.mean)) * mp.exp(v(1 / y) - top) / (1 + s * y) ** 2, [0, 1 / last])
    return top + mp.log(inner + outer)


def places(top, width, far):
    near = [top + k * width / 2 for k in range(-12, 13) if top + k * width / 2 > 0]
    grid = [mp.mpf(10) ** (-11 + mp.mpf(i) / 8) for i in range(0, 57)]
    return sorted(p for p in near + grid if p < far)


def extremum(v, guess):
    """Where the slope against ln h vanishes, by the secant method from a guess good to a fifth."""
    x = mp.log(mp.mpf(guess))
    return mp.exp(mp.findroot(lambda y: mp.diff(lambda t: v(mp.exp(t)), y), (x, x + mp.mpf('0.02'))))


def barrier(v, guess):
    top = extremum(v, guess)
    return top, v(top), 1 / mp.sqrt(-mp.diff(v, top, 2))


out = {'constants': 'CODATA 2018'}

out['hydrodynamic'] = [
    {'gapOverRadius': float(u), 'exact': float(bispherical(u))}
    for u in ['0.0001', '0.001', '0.01', '0.03', '0.1', '0.3', '1', '3', '10', '100']
]

CURVES = [
    ('ordinary', '1.5e-7', '1.5e-7', '5.35e-20', '0.04', '5', '2.2e-9'),
    ('low barrier', '5e-8', '5e-8', '3e-20', '0.035', '30', '1.3e-9'),
    ('thousands of kT', '1e-6', '1e-6', '1e-20', '0.08', '0.5', '0.78e-9'),
    ('unlike spheres', '1.5e-7', '6e-8', '2e-20', '0.035', '10', '1.2e-9'),
]
out['stabilityRatio'] = []
for name, a1, a2, A, psi, salt, guess in CURVES:
    v = Curve(a1, a2, A, psi, salt)
    top, height, width = barrier(v, guess)
    grid = places(top, width, mp.mpf('1e-5'))
    out['stabilityRatio'].append({
        'name': name,
        'radius1_m': float(a1), 'radius2_m': float(a2), 'hamakerConstant_J': float(A),
        'potential_V': float(psi), 'ionicStrength_mol_m3': float(salt),
        'relativePermittivity': 78.3, 'temperature_K': 298.15,
        'barrier_m': float(top), 'barrier_kT': float(height),
        'lnStabilityRatioFromContact': float(ln_w(v, CONTACT, grid)),
        'lnStabilityRatioFromNothing': float(ln_w(v, mp.mpf('1e-12'), sorted(grid + [mp.mpf('2e-12'), mp.mpf('5e-12')]))),
    })

# Attraction alone: from contact against from (almost) nothing. Matters only where contact is but a few kT deep.
out['attractionAlone'] = []
for a, A in [('1e-7', '1e-20'), ('2.5e-8', '5e-21'), ('2.5e-8', '1e-21')]:
    v = Curve(a, a, A, '0', '1')
    grid = [mp.mpf(10) ** (-11 + mp.mpf(i) / 8) for i in range(0, 49)]
    below = [mp.mpf(10) ** -k for k in (16, 15, 14, 13, 12)]
    out['attractionAlone'].append({
        'radius_m': float(a), 'hamakerConstant_J': float(A), 'temperature_K': 298.15,
        'lnStabilityRatioFromContact': float(ln_w(v, CONTACT, grid)),
        'lnStabilityRatioFromNothing': float(ln_w(v, mp.mpf('1e-17'), below + grid)),
    })

# A well outside a barrier: ordinary paint, large particles.
out['wells'] = []
for a, A, psi, salt, guess_top, guess_well in [
    ('3e-7', '1e-20', '0.04', '10', '1e-9', '1.5e-8'),
    ('3e-7', '2e-20', '0.04', '20', '1e-9', '1.1e-8'),
    ('5e-7', '3e-20', '0.04', '30', '1e-9', '8e-9'),
]:
    v = Curve(a, a, A, psi, salt)
    top, height, width = barrier(v, guess_top)
    well = extremum(v, guess_well)
    far = mp.mpf('5e-7')
    s = v.a1 + v.a2
    # Where the curve passes through zero on the way in, and the panels of the well.
    zero = mp.findroot(v, (top * mp.mpf('1.5'), well), solver='anderson')
    panels = sorted([zero, well] + [zero + (far - zero) * (mp.mpf(k) / 24) ** 3 for k in range(1, 25)])
    share_integral = mp.quad(lambda h: (s + h) ** 2 * mp.expm1(-v(h)), panels)
    beta = 2 * mp.pi * share_integral
    n = 3 * mp.mpf('0.01') / (4 * mp.pi * mp.mpf(a) ** 3)
    x = 2 * beta * n
    free = (mp.sqrt(1 + 4 * x) - 1) / (2 * x)
    eta = mp.mpf('0.00089')
    diffusion = 2 * v.kT / (6 * mp.pi * eta * mp.mpf(a))

    # Mean first passage: reflecting at the barrier, leaving at `far`; started at the bottom of the well.
    # T = ∫ B e^V/(D r²) ∫ r'² e^-V over the triangle; the inner integral accumulated with 20-point Gauss panels.
    mp.mp.dps = 20
    edges = sorted([top, well, zero] + [top + (well - top) * mp.mpf(k) / 24 for k in range(1, 24)]
                   + [well + (far - well) * (mp.mpf(k) / 40) ** 2 for k in range(1, 41)])
    inner, total = mp.mpf(0), mp.mpf(0)

    def weight(h):
        return (s + h) ** 2 * mp.exp(-v(h))

    for low, high in zip(edges, edges[1:]):
        if low >= well:
            total += mp.quad(
                lambda h: honig(h / v.mean) * mp.exp(v(h)) / (s + h) ** 2 * (inner + mp.quad(weight, [low, h], method='gauss-legendre', maxdegree=4)),
                [low, high], method='gauss-legendre', maxdegree=4)
        inner += mp.quad(weight, [low, high], method='gauss-legendre')
    mp.mp.dps = 30
    out['wells'].append({
        'radius1_m': float(a), 'radius2_m': float(a), 'hamakerConstant_J': float(A), 'potential_V': float(psi),
        'ionicStrength_mol_m3': float(salt), 'relativePermittivity': 78.3, 'temperature_K': 298.15,
        'viscosity_Pa_s': 0.00089, 'volumeFraction': 0.01,
        'barrier_m': float(top), 'barrier_kT': float(height), 'well_m': float(well), 'well_kT': float(v(well)),
        'far_m': float(far), 'pairedShare': float(1 - free), 'doubletsPerSingle': float(beta * n * free),
        'escapeTime_s': float(total / diffusion),
    })


# Layers: the free energy of mixing per area, integrated after Derjaguin.
def osmotic_by_area(h, delta, phi, chi, v1, a):
    """Two interpenetrating, then compressed layers of uniform density: V = π a ∫ W dh, W per area in kT."""
    def w(d):
        if d >= 2 * delta:
            return mp.mpf(0)
        if d >= delta:
            # overlap of width 2δ − d holds 2φ instead of φ twice: 4φ² − 2φ² each
            return (mp.mpf(1) / 2 - chi) / v1 * 2 * phi**2 * (2 * delta - d)
        # all chains in the gap d: density 2φδ/d
        return (mp.mpf(1) / 2 - chi) / v1 * (4 * phi**2 * delta**2 / d - 2 * phi**2 * delta)
    points = [h] + [p for p in (delta, 2 * delta) if p > h]
    return mp.pi * a * mp.quad(w, points) if len(points) > 1 else mp.mpf(0)


def one_sided_by_area(h, delta, phi, chi, v1, a):
    if h >= delta:
        return mp.mpf(0)
    return mp.pi * a * mp.quad(lambda d: (mp.mpf(1) / 2 - chi) / v1 * phi**2 * (delta**2 / d - delta), [h, delta])


out['layers'] = []
for h in ['0.5e-9', '2e-9', '4.9e-9', '5.1e-9', '7e-9', '9.9e-9']:
    args = [mp.mpf(t) for t in ('5e-9', '0.15', '0.45', '2.99e-29', '1e-7')]
    out['layers'].append({
        'separation_m': float(h), 'thickness_m': 5e-9, 'volumeFraction': 0.15, 'floryChi': 0.45,
        'solventMolecule_m3': 2.99e-29, 'meanRadius_m': 1e-7,
        'twoLayers_kT': float(osmotic_by_area(mp.mpf(h), *args)), 'oneLayer_kT': float(one_sided_by_area(mp.mpf(h), *args)),
    })

with open('numbers.json', 'w') as file:
    json.dump(out, file, indent=1)
    file.write('\n')
