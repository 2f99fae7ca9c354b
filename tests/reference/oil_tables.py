"""Handbook tables of oils and ethylene glycol, as data with their sources.

Set down from memory and checked for internal consistency. SI units; a row is temperature,
density, specific heat, viscosity, conductivity, expansion (NaN: to be fitted from density).
"""

from dataclasses import dataclass, field

NAN = float("nan")
INCROPERA = "Incropera & DeWitt, Fundamentals of Heat and Mass Transfer, Table A.5 (from memory)"


@dataclass
class Oil:
    id: str
    name: str
    source: str
    rows: list[tuple[float, ...]]
    limits: list[str] = field(default_factory=list)
    notes: list[str] = field(default_factory=list)


def unmeasured(density, viscosity):
    return (
        f"pressure error not measured; at 2000000 Pa about {density} in density and {viscosity} in viscosity "
        "by typical compressibility and pressure-viscosity coefficients (memory)"
    )


MINERAL_OIL = unmeasured("0.15 %", "4 %")

OILS = [
    Oil(
        "engine-oil",
        "engine oil, unused",
        INCROPERA,
        [
            (273, 899.1, 1796, 3.85, 0.147, NAN),
            (280, 895.3, 1827, 2.17, 0.144, NAN),
            (290, 890.0, 1868, 0.999, 0.145, NAN),
            (300, 884.1, 1909, 0.486, 0.145, NAN),
            (310, 877.9, 1951, 0.253, 0.145, NAN),
            (320, 871.8, 1993, 0.141, 0.143, NAN),
            (330, 865.8, 2035, 0.0836, 0.141, NAN),
            (340, 859.9, 2076, 0.0531, 0.139, NAN),
            (350, 853.9, 2118, 0.0356, 0.138, NAN),
            (360, 847.8, 2161, 0.0252, 0.138, NAN),
            (370, 841.8, 2206, 0.0186, 0.137, NAN),
            (380, 836.0, 2250, 0.0141, 0.136, NAN),
            (390, 830.6, 2294, 0.0110, 0.135, NAN),
            (400, 825.1, 2337, 0.00874, 0.134, NAN),
            (410, 818.9, 2381, 0.00698, 0.133, NAN),
            (420, 812.1, 2427, 0.00564, 0.133, NAN),
            (430, 806.5, 2471, 0.00470, 0.132, NAN),
        ],
        limits=["flash point: 473.15 K"],
        notes=[
            "flash point: about 200 degC, common practice for lubricating oils; the oil's own data sheet governs",
            "the source prints a constant expansion of 7.0e-4 1/K",
            MINERAL_OIL,
        ],
    ),
    Oil(
        "transformer-oil",
        "transformer oil, mineral",
        "Mikheev & Mikheeva, Fundamentals of Heat Transfer, appendix (from memory); viscosity is kinematic x density",
        [
            (273.15, 892.5, 1549, 0.062921, 0.1123, 6.80e-4),
            (293.15, 880.3, 1666, 0.019807, 0.1106, 6.90e-4),
            (313.15, 868.2, 1788, 0.0089425, 0.1090, 7.00e-4),
            (333.15, 856.0, 1905, 0.0049477, 0.1072, 7.10e-4),
            (353.15, 843.9, 2026, 0.0030887, 0.1056, 7.20e-4),
            (373.15, 831.8, 2144, 0.0021294, 0.1038, 7.30e-4),
            (393.15, 819.6, 2261, 0.0015736, 0.1022, 7.40e-4),
        ],
        limits=["flash point: 408.15 K"],
        notes=[
            "flash point: least value of IEC 60296 for mineral oil, 135 degC closed cup (memory)",
            MINERAL_OIL,
        ],
    ),
    Oil(
        "ethylene-glycol",
        "ethylene glycol, pure",
        INCROPERA,
        [
            (280, 1125.8, 2323, 0.0420, 0.244, 6.5e-4),
            (300, 1114.4, 2415, 0.0157, 0.252, 6.5e-4),
            (320, 1096.2, 2505, 0.00757, 0.258, 6.5e-4),
            (340, 1083.8, 2592, 0.00431, 0.261, 6.5e-4),
            (360, 1074.0, 2682, 0.00278, 0.261, 6.5e-4),
        ],
        limits=["freezing: 260 K", "flash point: 384.15 K"],
        notes=[
            "freezing point 260 K and closed-cup flash point 111 degC (memory)",
            "expansion as the source prints it: its densities are too rough to differentiate",
            unmeasured("0.08 %", "1 to 2 %"),
        ],
    ),
]
