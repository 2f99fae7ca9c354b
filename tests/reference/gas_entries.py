"""Gases whose tables are made from reference equations, as data with their sources.

Authors, years and pages are those that CoolProp's bibliography gives for the equations it
evaluates.
"""

from dataclasses import dataclass, field

import numpy as np

ATMOSPHERE = 101325.0  # Pa, standard atmosphere, ISO 2533


@dataclass
class Gas:
    """A gas, its reference equations and the range of its table."""

    id: str
    name: str
    library_name: str
    temperatures: np.ndarray
    source: str
    layers: list[float] = field(default_factory=lambda: [ATMOSPHERE])
    range: tuple[float, float] = (50e3, 200e3)
    saturates: bool = False
    composition: list[str] = field(default_factory=list)
    notes: list[str] = field(default_factory=list)


LEMMON_JACOBSEN = (
    "viscosity and conductivity: Lemmon & Jacobsen 2004, Int. J. Thermophys. 25, 21-69"
)
WATER_SOURCE = (
    "IAPWS-95: Wagner & Pruss 2002, J. Phys. Chem. Ref. Data 31, 387-535; "
    "viscosity: IAPWS R12-08, Huber et al. 2009, J. Phys. Chem. Ref. Data 38, 101-125; "
    "conductivity: IAPWS R15-11, Huber et al. 2012, J. Phys. Chem. Ref. Data 41, 033102"
)


def extrapolated(limit):
    return f"the equation of state was fitted up to {limit} K (memory); extrapolated above"


GASES = [
    Gas(
        "air",
        "dry air",
        "Air",
        np.arange(150.0, 2001, 10),
        "Lemmon, Jacobsen, Penoncello & Friend 2000, J. Phys. Chem. Ref. Data 29, 331-385; "
        + LEMMON_JACOBSEN,
        layers=[30e3, ATMOSPHERE, 500e3, 1e6],
        composition=["composition: humidity"],
        notes=[
            "no dissociation: above 1500 K real air departs from a fixed mixture",
            "humid: within 0.1 % in density, 0.8 % in specific heat, 2.4 % in viscosity, 4 % in conductivity "
            "and 0.6 % in expansion of CoolProp's humid air at the same relative humidity, "
            "0 to 90 degC and 0.8 to 1.2 bar",
        ],
    ),
    Gas(
        "nitrogen",
        "nitrogen",
        "Nitrogen",
        np.arange(150.0, 1501, 10),
        "Span, Lemmon, Jacobsen, Wagner & Yokozeki 2000, J. Phys. Chem. Ref. Data 29, 1361-1433; "
        + LEMMON_JACOBSEN,
        notes=[extrapolated(1000)],
    ),
    Gas(
        "carbon-dioxide",
        "carbon dioxide",
        "CarbonDioxide",
        np.arange(220.0, 1501, 10),
        "Span & Wagner 1996, J. Phys. Chem. Ref. Data 25, 1509-1596; "
        "viscosity: Laesecke & Muzny 2017, J. Phys. Chem. Ref. Data 46; "
        "conductivity: Huber, Sykioti, Assael & Perkins 2016, J. Phys. Chem. Ref. Data 45",
        notes=[extrapolated(1100)],
    ),
    Gas(
        "argon",
        "argon",
        "Argon",
        np.arange(150.0, 1501, 10),
        "Tegeler, Span & Wagner 1999, J. Phys. Chem. Ref. Data 28, 779-850; " + LEMMON_JACOBSEN,
        notes=[extrapolated(700)],
    ),
    Gas(
        "helium",
        "helium",
        "Helium",
        np.arange(150.0, 1501, 10),
        "Ortiz-Vega, Hall, Holste, Arp, Harvey & Lemmon 2019; viscosity: Arp, McCarty & Friend 1998; "
        "conductivity: Hands & Arp 1981, Cryogenics 21, 697-703",
    ),
    Gas(
        "hydrogen",
        "normal hydrogen",
        "Hydrogen",
        np.arange(150.0, 1001, 10),
        "Leachman, Jacobsen, Penoncello & Lemmon 2009, J. Phys. Chem. Ref. Data 38, 721-748; "
        "viscosity: Muzny, Huber & Kazakov 2013, J. Chem. Eng. Data; "
        "conductivity: Assael et al. 2011, J. Phys. Chem. Ref. Data 40, 033101",
        notes=["flammable: leaks burn or explode in air"],
    ),
    Gas(
        "oxygen",
        "oxygen",
        "Oxygen",
        np.arange(150.0, 1001, 10),
        "Schmidt & Wagner 1985, Fluid Phase Equilib. 19, 175-200, and Stewart, Jacobsen & Wagner 1991, "
        "J. Phys. Chem. Ref. Data 20, 917-1021; " + LEMMON_JACOBSEN,
        notes=[
            "fire hazard: feeds fire; oil, grease and many metals burn in it",
            extrapolated(300),
        ],
    ),
    Gas(
        "methane",
        "methane",
        "Methane",
        np.arange(150.0, 621, 10),
        "Setzmann & Wagner 1991, J. Phys. Chem. Ref. Data 20, 1061-1155; "
        "viscosity: Quinones-Cisneros & Deiters 2006, J. Phys. Chem. B 110, 12820-12834; "
        "conductivity: Friend, Ely & Ingham 1989, J. Phys. Chem. Ref. Data 18, 583-638",
        notes=[
            "flammable: leaks burn or explode in air",
            "viscosity at 300 K lies about 1 % above measurements near zero density (memory)",
        ],
    ),
    Gas(
        "steam",
        "steam (water vapour)",
        "Water",
        np.concatenate([[373.12, 375, 377.5, 380, 385, 390, 395], np.arange(400.0, 1271, 10)]),
        WATER_SOURCE,
        saturates=True,
        notes=[
            "the pressure rule is poorest near saturation at 200000 Pa, where the pressure error stands",
            "the first row lies 0.004 K below saturation at 101325 Pa: the vapour equations continued",
        ],
    ),
]
