//! The kinds of quantity.

use super::units::{self, Unit};

/// Declares [`Kind`], its list and its names from one list.
macro_rules! kinds {
    ($($(#[$meta:meta])+ $kind:ident = $name:literal,)+) => {
        /// What a number measures.
        #[derive(Clone, Copy, Debug, PartialEq, Eq, Hash)]
        pub enum Kind {
            $($(#[$meta])+ $kind,)+
        }

        impl Kind {
            /// Every kind, in the order of declaration.
            pub const ALL: [Kind; [$($name),+].len()] = [$(Kind::$kind),+];

            /// The name that requests use, in snake case.
            pub const fn name(self) -> &'static str {
                match self {
                    $(Kind::$kind => $name,)+
                }
            }
        }
    };
}

kinds! {
    /// Thermodynamic temperature, a point on a scale.
    Temperature = "temperature",
    /// Temperature difference; never shifted.
    TemperatureDifference = "temperature_difference",
    /// Length.
    Length = "length",
    /// Area.
    Area = "area",
    /// Volume.
    Volume = "volume",
    /// Speed.
    Speed = "speed",
    /// Absolute pressure.
    Pressure = "pressure",
    /// Heat flow rate, power.
    HeatFlow = "heat_flow",
    /// Heat flow rate per area.
    HeatFlux = "heat_flux",
    /// Heat flow rate per length.
    HeatFlowPerLength = "heat_flow_per_length",
    /// Heat transfer coefficient.
    Coefficient = "coefficient",
    /// Thermal conductivity.
    Conductivity = "conductivity",
    /// Thermal resistance of an area.
    Resistance = "resistance",
    /// Energy, amount of heat.
    Energy = "energy",
    /// Mass.
    Mass = "mass",
    /// Time.
    Time = "time",
    /// Plane angle, in degrees inside the service as well.
    Angle = "angle",
    /// Acceleration.
    Acceleration = "acceleration",
    /// Density.
    Density = "density",
    /// Specific heat capacity.
    SpecificHeat = "specific_heat",
    /// Dynamic viscosity.
    Viscosity = "viscosity",
    /// Kinematic viscosity and the diffusivities.
    KinematicViscosity = "kinematic_viscosity",
    /// Volumetric thermal expansion coefficient.
    Expansion = "expansion",
    /// A pure number or fraction.
    Number = "number",
}

impl Kind {
    /// The kind of that name, if there is one.
    pub fn from_name(name: &str) -> Option<Kind> {
        Kind::ALL.into_iter().find(|kind| kind.name() == name)
    }

    /// The unit that values of this kind have inside the service.
    pub fn si_unit(self) -> Unit {
        units::first(self)
    }

    /// Every unit that this kind is read and written in, the internal one first.
    pub fn units(self) -> impl Iterator<Item = Unit> {
        units::of(self)
    }
}

#[cfg(test)]
mod tests {
    use super::Kind;

    #[test]
    fn names_are_unique_and_lead_back() {
        for kind in Kind::ALL {
            assert_eq!(Kind::from_name(kind.name()), Some(kind));
        }
        assert_eq!(Kind::from_name("Length"), None);
        assert_eq!(Kind::from_name(""), None);
    }

    #[test]
    fn internal_units_are_coherent_si_but_for_angles_in_degrees() {
        let symbols: Vec<_> = Kind::ALL
            .iter()
            .map(|kind| (kind.name(), kind.si_unit().symbol()))
            .collect();
        assert_eq!(
            symbols,
            [
                ("temperature", "K"),
                ("temperature_difference", "K"),
                ("length", "m"),
                ("area", "m2"),
                ("volume", "m3"),
                ("speed", "m/s"),
                ("pressure", "Pa"),
                ("heat_flow", "W"),
                ("heat_flux", "W/m2"),
                ("heat_flow_per_length", "W/m"),
                ("coefficient", "W/(m2 K)"),
                ("conductivity", "W/(m K)"),
                ("resistance", "m2 K/W"),
                ("energy", "J"),
                ("mass", "kg"),
                ("time", "s"),
                ("angle", "deg"),
                ("acceleration", "m/s2"),
                ("density", "kg/m3"),
                ("specific_heat", "J/(kg K)"),
                ("viscosity", "Pa s"),
                ("kinematic_viscosity", "m2/s"),
                ("expansion", "1/K"),
                ("number", "1"),
            ]
        );
        for unit in Kind::ALL.map(Kind::si_unit) {
            assert!(unit.is_si());
            assert_eq!(unit.to_si(0.1), 0.1, "{}", unit.symbol());
            assert_eq!(unit.from_si(0.1), 0.1, "{}", unit.symbol());
        }
    }
}
