//! Publications that more than one method comes from.

use super::entry::Source;

/// The handbook chapter whose blends are the automatic choice for most bodies.
pub const HANDBOOK: Source = Source {
    authors: "Raithby, G. D.; Hollands, K. G. T.",
    year: 1998,
    work: "Handbook of Heat Transfer, 3rd ed. (Rohsenow, Hartnett, Cho)",
    locator: "ch. 4, Natural convection",
};

/// Upright plates.
pub const CHURCHILL_CHU_PLATE: Source = Source {
    authors: "Churchill, S. W.; Chu, H. H. S.",
    year: 1975,
    work: "Int. J. Heat Mass Transfer 18",
    locator: "1323-1329",
};

/// Lying cylinders.
pub const CHURCHILL_CHU_CYLINDER: Source = Source {
    authors: "Churchill, S. W.; Chu, H. H. S.",
    year: 1975,
    work: "Int. J. Heat Mass Transfer 18",
    locator: "1049-1053",
};

/// Power laws for everyday work.
pub const MCADAMS: Source = Source {
    authors: "McAdams, W. H.",
    year: 1954,
    work: "Heat Transmission, 3rd ed.",
    locator: "ch. 7",
};

/// Plates that lean.
pub const FUJII_IMURA: Source = Source {
    authors: "Fujii, T.; Imura, H.",
    year: 1972,
    work: "Int. J. Heat Mass Transfer 15",
    locator: "755-767",
};

/// Plates that lean, turbulent.
pub const VLIET: Source = Source {
    authors: "Vliet, G. C.",
    year: 1969,
    work: "J. Heat Transfer 91",
    locator: "511-516",
};

/// Glazing.
pub const EN_673: Source = Source {
    authors: "CEN",
    year: 2011,
    work: "EN 673, Glass in building: thermal transmittance",
    locator: "5.3.3, from memory",
};
