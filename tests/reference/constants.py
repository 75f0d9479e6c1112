"""Constants that follow exactly from the defining ones, to thirty digits, as JSON text.

The seven defining constants are those of the SI Brochure, 9th edition (2019); everything else is
arithmetic with decimals, so that no rounding of a double is shared with the product. The values are
the same under CODATA 2018 and 2022.
"""

import json
from decimal import Decimal, getcontext

getcontext().prec = 50
PI = Decimal("3.14159265358979323846264338327950288419716939937510582")

c = Decimal(299792458)
h = Decimal("6.62607015e-34")
e = Decimal("1.602176634e-19")
k = Decimal("1.380649e-23")
N_A = Decimal("6.02214076e23")
# IAU 2012 Resolution B2, IAU 2015 Resolution B2.
au = Decimal(149597870700)


def displacement():
    """x in x = 5 (1 - exp(-x)): where x^5/(exp(x) - 1) is greatest."""
    x = Decimal(5)
    for _ in range(100):
        x = 5 * (1 - (-x).exp())
    return x


sigma = 2 * PI**5 * k**4 / (15 * h**3 * c**2)
print(
    json.dumps(
        {
            "c": str(c),
            "h": str(h),
            "q_e": str(e),
            "k_B": str(k),
            "N_A": str(N_A),
            "hbar": str(h / (2 * PI)),
            "R_gas": str(N_A * k),
            "F_faraday": str(N_A * e),
            "sigma_SB": str(sigma),
            "a_rad": str(4 * sigma / c),
            "b_wien": str(h * c / (k * displacement())),
            "au": str(au),
            "pc": str(au * 648000 / PI),
            "ly": str(c * 31557600),
        }
    )
)
