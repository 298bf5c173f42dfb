"""Makes numbers.json: high-precision references for the double-layer room.

Independent of the program: other formulas where there are any, 30 digits (mpmath) or tight ODE tolerances (SciPy).
Run in this folder: /usr/bin/python3 makeNumbers.py
"""
import json

import mpmath as mp
import numpy as np
from scipy.integrate import quad, solve_ivp
from scipy.optimize import brentq

mp.mp.dps = 30

# CODATA 2018
BOLTZMANN = mp.mpf('1.380649e-23')
CHARGE = mp.mpf('1.602176634e-19')
AVOGADRO = mp.mpf('6.02214076e23')
EPSILON0 = mp.mpf('8.8541878128e-12')

SALTS = {
    '1:1': [(1, 1), (-1, 1)],
    '2:2': [(2, 1), (-2, 1)],
    '2:1': [(2, 1), (-1, 2)],
    '1:2': [(1, 2), (-2, 1)],
    '3:1': [(3, 1), (-1, 3)],
    'sodium with calcium': [(1, 10), (2, mp.mpf('0.5')), (-1, 11)],
    'trace of a trivalent ion': [(1, 10), (3, mp.mpf('1e-6')), (-1, 10 + 3 * mp.mpf('1e-6'))],
}


def screening(ions):
    return sum(c * z**2 for z, c in ions)


def field(ions, y):
    """|dy/d(kappa x)|, straight from the first integral; 30 digits make the cancellation harmless."""
    return mp.sqrt(2 * sum(c * mp.expm1(-z * y) for z, c in ions) / screening(ions))


def flat(ions, y0):
    """Effective reduced potential: the profile is followed down to 1e-9, where its linear and quadratic part are known."""
    y0 = mp.mpf(y0)
    mp.mp.dps = 45
    sign = mp.sign(y0)
    small = mp.mpf('1e-9')
    # near zero F = y (1 + b y + ...), so ln Y = ln small - b small after the end of the quadrature
    b = -sum(c * z**3 for z, c in ions) / screening(ions) / 6
    points = [small] + [p for p in (mp.mpf(10) ** k for k in range(-8, 0)) if p < abs(y0)]
    points += [mp.mpf(n) / 2 for n in range(1, 200) if mp.mpf(n) / 2 < abs(y0)] + [abs(y0)]
    distance = mp.quad(lambda t: 1 / field(ions, sign * t), points)
    result = sign * small * mp.exp(distance - sign * b * small)
    mp.mp.dps = 30
    return result


def bell_levine_mccartney(y, kappa_a):
    y, kappa_a = mp.mpf(y), mp.mpf(kappa_a)
    t = mp.tanh(y / 4)
    return 8 * t / (1 + mp.sqrt(1 - (2 * kappa_a + 1) / (kappa_a + 1) ** 2 * t**2))


def sphere(ions, y0, kappa_a):
    """Effective reduced potential of a sphere and the field at its surface, in units of kappa kT/e.

    The equation is solved inwards from the far field, whose height is found by bracketing.

    x = kappa (r - a); y = Y kappa_a/(kappa_a + x) exp(-x) far out.
    """
    ions = [(z, float(c)) for z, c in ions]
    total = sum(c * z * z for z, c in ions)
    charge = lambda y: -sum(z * c * (np.exp(-z * y) + z * y - 1 if abs(z * y) > 1e-3 else (z * y) ** 2 / 2 - (z * y) ** 3 / 6) for z, c in ions) / total + y
    # -sum z c e^{-zy} = -sum z c (e^{-zy} - 1 + z y) + sum c z^2 y for a neutral bulk

    def surface(far):
        start = np.log(abs(far)) + 12 if abs(far) > 1 else 12.0
        y = far * kappa_a / (kappa_a + start) * np.exp(-start)
        dy = -y * (1 + 1 / (kappa_a + start))
        right = lambda x, s: [s[1], charge(s[0]) - 2 / (kappa_a + x) * s[1]]
        stop = lambda x, s: abs(s[0]) - 40
        stop.terminal = True
        s = solve_ivp(right, (start, 0), [y, dy], method='DOP853', rtol=1e-12, atol=1e-18, events=stop)
        return (s.y[0, -1], -s.y[1, -1]) if s.status == 0 else (np.sign(far) * 40, np.sign(far) * np.inf)

    target = float(y0)
    low, high = 1e-3 * target, target
    while abs(surface(high)[0]) < abs(target):
        high *= 2
    far = brentq(lambda far: surface(far)[0] - target, low, high, rtol=1e-11)
    return {'effectivePotential': far, 'field': surface(far)[1]}


def like_plates(y0, kappa_h, held):
    """Energy per area of two like plates in a 1:1 salt, in units of nkT/kappa, with the potential or the charge held.

    y0 is the potential far apart. kappa h/2 = int_ym^ys dy / sqrt(2(cosh y - cosh ym)), pressure 2(cosh ym - 1) nkT;
    W = int_h^inf P dh is integrated by parts over the potential ym in the middle. Double precision, about 1e-9.
    """

    def at_surface(ym):
        return y0 if held == 'potential' else np.arccosh(np.cosh(ym) + 2 * np.sinh(y0 / 2) ** 2)

    def gap(ym):
        rise = at_surface(ym) - ym
        if rise <= 0:
            return 0.0
        # y = ym + s^2 takes the root out of the integrand; cosh y - cosh ym = 2 sinh((y+ym)/2) sinh((y-ym)/2)
        integrand = lambda s: 2 * s / np.sqrt(4 * np.sinh(ym + s * s / 2) * np.sinh(s * s / 2))
        top = np.sqrt(rise)
        knee = min(top / 2, np.sqrt(2 * ym))
        parts = [quad(integrand, a, b, epsabs=0, epsrel=1e-11, limit=400)[0] for a, b in ((0, knee), (knee, top))]
        return 2 * sum(parts)

    highest = y0 if held == 'potential' else 60.0
    ym = np.exp(brentq(lambda t: gap(np.exp(t)) - kappa_h, np.log(1e-6 * y0), np.log(highest * (1 - 1e-9)), rtol=1e-14))
    spread = lambda t: (gap(np.exp(t)) - kappa_h) * 2 * np.sinh(np.exp(t)) * np.exp(t)
    return quad(spread, np.log(ym) - 18, np.log(ym), epsabs=0, epsrel=1e-9, limit=400)[0]


def number(x):
    return float(mp.nstr(x, 17))


numbers = {
    'constants': 'CODATA 2018',
    'flat': [
        {
            'salt': name,
            'ions': [{'valence': z, 'concentration_mol_m3': number(mp.mpf(c))} for z, c in ions],
            'reducedPotential': y,
            'effectivePotential': number(flat(ions, y)),
        }
        for name, ions in SALTS.items()
        for y in (0.001, -0.001, 0.3, -0.3, 1, -1, 2.5, -2.5, 6, -6, 15, -15)
    ],
    'bellLevineMcCartney': [
        {'reducedPotential': y, 'kappaRadius': k, 'effectivePotential': number(bell_levine_mccartney(y, k))}
        for y in (0.01, 1, 4, 20)
        for k in (0.1, 1, 5, 30, 1000)
    ],
    'sphere': [
        {
            'salt': name,
            'ions': [{'valence': z, 'concentration_mol_m3': number(mp.mpf(c))} for z, c in SALTS[name]],
            'reducedPotential': y,
            'kappaRadius': k,
            **sphere(SALTS[name], y, k),
        }
        for name in ('1:1', '2:1', '1:2', 'sodium with calcium')
        for y in (1, -1, 2, -2, 4, -4)
        for k in (0.3, 1, 3, 10, 50)
    ],
    'likePlates': [
        {'held': held, 'reducedPotential': y, 'kappaGap': k, 'energy_per_nkT_kappa': like_plates(y, k, held)}
        for held in ('potential', 'charge')
        for y in (0.25, 0.5, 1, 2, 4)
        for k in (0.3, 1, 2, 3, 5)
    ],
    'lengths': [
        {
            'valence': z,
            'concentration_mol_m3': c,
            'relativePermittivity': e,
            'temperature_K': t,
            'debyeLength_m': number(mp.sqrt(mp.mpf(e) * EPSILON0 * BOLTZMANN * mp.mpf(t) / (2 * AVOGADRO * CHARGE**2 * c * z * z))),
            'bjerrumLength_m': number(CHARGE**2 / (4 * mp.pi * mp.mpf(e) * EPSILON0 * BOLTZMANN * mp.mpf(t))),
        }
        for z, c, e, t in ((1, 1, '78.3', '298.15'), (2, 50, '60', '323.15'), (1, 0.001, '2', '293.15'))
    ],
}
for row in numbers['lengths']:
    row['relativePermittivity'] = float(row['relativePermittivity'])
    row['temperature_K'] = float(row['temperature_K'])

with open('numbers.json', 'w') as file:
    json.dump(numbers, file, indent=1)
    file.write('\n')
