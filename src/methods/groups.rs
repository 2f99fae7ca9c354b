//! The dimensionless groups that formulas are entered with.

/// What a formula sees of a case. What a body does not have is 0.
#[derive(Clone, Copy, Debug, Default, PartialEq)]
pub struct Groups {
    /// Rayleigh number on the body's characteristic length.
    pub rayleigh: f64,
    /// Prandtl number.
    pub prandtl: f64,
    /// Angle of a plate or cylinder from the vertical, of a layer from the horizontal, degrees.
    pub tilt: f64,
    /// Height or length of a cylinder over its diameter.
    pub slenderness: f64,
    /// Area over perimeter of an inclined plate, over its length along the slope.
    pub length_ratio: f64,
    /// Height of a layer, cavity or channel over its gap.
    pub aspect: f64,
    /// Longer horizontal side of a block over the root of its whole area.
    pub block_length: f64,
    /// Shorter horizontal side, likewise.
    pub block_width: f64,
    /// Height, likewise.
    pub block_height: f64,
    /// How many walls of a channel are heated.
    pub heated_walls: f64,
}

impl Groups {
    /// Rayleigh and Prandtl numbers alone, for bodies that need no more.
    pub const fn new(rayleigh: f64, prandtl: f64) -> Self {
        Groups {
            rayleigh,
            prandtl,
            tilt: 0.0,
            slenderness: 0.0,
            length_ratio: 0.0,
            aspect: 0.0,
            block_length: 0.0,
            block_width: 0.0,
            block_height: 0.0,
            heated_walls: 0.0,
        }
    }

    /// The same with an angle, degrees.
    pub const fn tilted(self, tilt: f64) -> Self {
        Groups { tilt, ..self }
    }

    /// The same with a height over the gap.
    pub const fn with_aspect(self, aspect: f64) -> Self {
        Groups { aspect, ..self }
    }

    /// The same with a height or length over the diameter.
    pub const fn with_slenderness(self, slenderness: f64) -> Self {
        Groups {
            slenderness,
            ..self
        }
    }

    /// The same with another Rayleigh number.
    pub const fn at_rayleigh(self, rayleigh: f64) -> Self {
        Groups { rayleigh, ..self }
    }

    /// Rayleigh number with the part of gravity that lies along an inclined surface.
    pub fn rayleigh_along(&self) -> f64 {
        self.rayleigh * self.tilt.to_radians().cos()
    }

    /// Rayleigh number weighted for thin boundary layers.
    pub fn rayleigh_weighted(&self) -> f64 {
        self.rayleigh * self.prandtl / (0.2 + self.prandtl)
    }

    /// Curvature of the boundary layer on an upright cylinder, `32^(1/2) Gr_H^(-1/4) H/D`.
    ///
    /// # Source
    /// Cebeci 1974, 5th Int. Heat Transfer Conf. 3, 15-19.
    pub fn curvature(&self) -> f64 {
        32_f64.sqrt() * (self.rayleigh / self.prandtl).powf(-0.25) * self.slenderness
    }
}
