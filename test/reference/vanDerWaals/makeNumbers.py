"""Independent high-precision numbers for core/vanDerWaals.

Run:  /usr/bin/python3 makeNumbers.py   (Debian packages python3-mpmath, python3-scipy), then commit numbers.json.

- trilogarithm: mpmath.polylog(3, x) at 40 digits.
- geometry: Hamaker's closed form for two spheres at 60 digits, so that no cancellation matters.
- lifshitz: every Matsubara term to n = 4000 one by one with mpmath.polylog, the rest by SciPy's quad on the integral
  in n plus the end-point terms of Euler-Maclaurin (whose next term is below 1e-14 of the sum there).
"""
import json
import math
from mpmath import mp, mpf, polylog, log
from scipy.integrate import quad

mp.dps = 40
KB, HBAR = mpf('1.380649e-23'), mpf('6.62607015e-34') / (2 * mp.pi)
TEMPERATURE_K = mpf('298.15')

# Oscillators (strength, rad/s) and damped terms (f, omega, g); orders of magnitude as published, rounded freely.
WATER = dict(
    static=78.3553,
    oscillators=[(0.75415, 1.8883e16)],
    damped=[
        (1.45414935603766e27, 31904616424999.723, 22789011732142.656),
        (8.078607533542556e27, 104829453967856.23, 57732163054761.4),
        (3.000625655315806e27, 139772605290474.97, 42539488566666.3),
        (1.255646428070614e27, 303853489761902.1, 37981686220237.766),
        (3.2314430134170223e28, 638092328499994.4, 85078977133332.6),
    ],
)
POLYSTYRENE = dict(static=2.55, oscillators=[(0.126, 5.54e14), (1.424, 1.432e16)], damped=[])
RUTILE = dict(static=114.0, oscillators=[(109.67, 3.5802e13), (5.2932, 7.7387e15)], damped=[])
PTFE = dict(static=2.1, oscillators=[(0.254, 2.27e14), (0.846, 1.793e16)], damped=[])
CYCLOHEXANE = dict(static=2.0165, oscillators=[(0.0131, 5.54e14), (1.0034, 1.84e16)], damped=[])
ALUMINA = dict(static=10.1, oscillators=[(7.0382, 1e14), (2.0618, 2e16)], damped=[])
SYSTEMS = {
    'polystyrene-water-polystyrene': (POLYSTYRENE, WATER, POLYSTYRENE),
    'rutile-water-polystyrene': (RUTILE, WATER, POLYSTYRENE),
    'ptfe-cyclohexane-alumina': (PTFE, CYCLOHEXANE, ALUMINA),
}


def eps(body, xi):
    value = mpf(1)
    for c, w in body['oscillators']:
        value += mpf(c) / (1 + (xi / mpf(w)) ** 2)
    for f, w, g in body['damped']:
        value += mpf(f) / (mpf(w) ** 2 + mpf(g) * xi + xi**2)
    return value


def product(system, xi):
    one, medium, two = (eps(body, xi) for body in system)
    return (one - medium) / (one + medium) * (two - medium) / (two + medium)


def static_product(system):
    one, medium, two = (mpf(body['static']) for body in system)
    return (one - medium) / (one + medium) * (two - medium) / (two + medium)


def li3(x):
    """Series for the small arguments that occur, polylog otherwise; both at working precision."""
    return polylog(3, x).real


def dispersion(system, explicit=4000):
    kt = KB * TEMPERATURE_K
    xi1 = 2 * mp.pi * kt / HBAR
    mp.dps = 25
    f = lambda n: li3(product(system, n * xi1))
    total = mp.fsum(f(n) for n in range(1, explicit + 1))
    g = lambda u: float(f(mpf(math.exp(u))) * mpf(math.exp(u)))
    scale = g(math.log(explicit))
    # n from `explicit` to 1e9, in ln n
    integral = sum(
        quad(lambda u: g(u) / scale, a, a + 1, epsabs=0, epsrel=1e-12)[0] * scale
        for a in [math.log(explicit) + k for k in range(12)]
    )
    end = f(mpf(explicit))
    derivative = f(mpf(explicit) + mpf('0.5')) - f(mpf(explicit) - mpf('0.5'))
    total += mpf(integral) - end / 2 - derivative / 12
    mp.dps = 40
    return mpf(3) / 2 * kt * total


def sphere_pair(a, b, h):
    mp.dps = 60
    a, b, h = mpf(a), mpf(b), mpf(h)
    r = a + b + h
    x, y = r**2 - (a + b) ** 2, r**2 - (a - b) ** 2
    value = -(2 * a * b / x + 2 * a * b / y + log(x / y)) / 6
    mp.dps = 40
    return value


def sphere_plate(a, h):
    mp.dps = 60
    a, h = mpf(a), mpf(h)
    value = -(a / h + a / (h + 2 * a) + log(h / (h + 2 * a))) / 6
    mp.dps = 40
    return value


def main():
    arguments = [-1, -0.99, -0.75, -0.5, -0.3, -1e-3, 1e-8, 0.05, 0.3, 0.49, 0.51, 0.6, 0.75, 0.9, 0.99, 0.9999, 1 - 2.0**-40, 1]
    pairs = []
    for a in (1.0, 3.7e-2, 250.0):
        for exponent in range(-6, 7):
            h = float(f'1e{exponent}')
            pairs.append(dict(radius1_m=1.0, radius2_m=a, separation_m=h, energyOverHamaker=float(sphere_pair(1.0, a, h))))
    plates = [
        dict(radius_m=1.0, separation_m=float(f'1e{e}'), energyOverHamaker=float(sphere_plate(1.0, float(f'1e{e}'))))
        for e in range(-6, 7)
    ]
    lifshitz = {}
    for name, system in SYSTEMS.items():
        zero = mpf(3) / 4 * KB * TEMPERATURE_K * li3(static_product(system))
        lifshitz[name] = dict(zeroFrequency_J=float(zero), dispersion_J=float(dispersion(system)))
    numbers = dict(
        about='Made by makeNumbers.py with mpmath and SciPy; not copied from the program.',
        temperature_K=float(TEMPERATURE_K),
        trilogarithm=[dict(x=x, value=float(li3(mpf(x)))) for x in arguments],
        spherePair=pairs,
        spherePlate=plates,
        bodies=dict(water=WATER, polystyrene=POLYSTYRENE, rutile=RUTILE, ptfe=PTFE, cyclohexane=CYCLOHEXANE, alumina=ALUMINA),
        lifshitz=lifshitz,
    )
    with open('numbers.json', 'w') as file:
        json.dump(numbers, file, indent=1)
        file.write('\n')


if __name__ == '__main__':
    main()
