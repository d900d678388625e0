"""Single-phase flow through every primary element, by python3-fluids: writes single-phase-flow.csv to standard output.

The Venturi nozzle is left out: fluids 1.0.22 has 0.198 in its coefficient where ISO 5167-3 prints 0.196.
Reynolds numbers stay above 5000, where fluids' Reader-Harris/Gallagher equation is that of ISO 5167-2.
"""
import math
import random

import fluids
from fluids.flow_meter import differential_pressure_meter_solver as solve

random.seed(5167)
KINDS = [
    ("orifice", "corner", "ISO 5167 orifice"),
    ("orifice", "D", "ISO 5167 orifice"),
    ("orifice", "flange", "ISO 5167 orifice"),
    ("isa1932", "", "ISA 1932 nozzle"),
    ("long_radius", "", "long radius nozzle"),
    ("venturi_machined", "", "machined convergent venturi tube"),
    ("venturi_as_cast", "", "as cast convergent venturi tube"),
    ("venturi_welded", "", "rough welded convergent venturi tube"),
]
print(f"# source: python3-fluids {fluids.__version__}, differential_pressure_meter_solver; see tests/generators/single_phase_flow.py")
print("# SI units; isentropic exponent and expansibility apply to the upstream pressure p1")
print("kind,taps,D_m,d_m,rho_kg_m3,mu_Pa_s,kappa,p1_Pa,p2_Pa,m_kg_s")
for kind, taps, name in KINDS:
    rows = 0
    while rows < 12:
        pipe = round(random.uniform(0.05, 0.25), 4)
        throat = round(pipe * random.uniform(0.4, 0.7), 5)
        p1 = round(random.uniform(0.2e6, 15e6), -2)
        p2 = round(p1 * (1 - random.uniform(0.002, 0.2)), -1)
        rho, mu, kappa = round(random.uniform(1, 90), 3), round(random.uniform(1e-5, 2.5e-5), 8), round(random.uniform(1.2, 1.4), 3)
        m = solve(D=pipe, D2=throat, rho=rho, mu=mu, k=kappa, P1=p1, P2=p2, meter_type=name, taps=taps or None)
        if 4 * m / (math.pi * mu * pipe) < 5000:
            continue
        print(f"{kind},{taps},{pipe},{throat},{rho},{mu},{kappa},{p1},{p2},{m:.12g}")
        rows += 1
