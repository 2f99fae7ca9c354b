//! Closed sets of words: one list gives the type, its texts and its order.

/// Declares an enum whose variants are known outside by a fixed text.
macro_rules! choice {
    ($(#[$doc:meta])* $name:ident { $($(#[$variant_doc:meta])* $variant:ident = $text:literal,)+ }) => {
        $(#[$doc])*
        #[derive(Clone, Copy, Debug, PartialEq, Eq, Hash, PartialOrd, Ord)]
        pub enum $name { $($(#[$variant_doc])* $variant,)+ }

        impl $name {
            /// Every value, in the order of the list.
            pub const ALL: &'static [$name] = &[$($name::$variant,)+];
            /// The texts of [`Self::ALL`], in the same order.
            pub const TEXTS: &'static [&'static str] = &[$($text,)+];

            /// The text that stands for this value in requests and answers.
            pub const fn as_str(self) -> &'static str {
                Self::TEXTS[self as usize]
            }

            /// The value that a text stands for.
            pub fn from_text(text: &str) -> Option<Self> {
                match text { $($text => Some($name::$variant),)+ _ => None }
            }
        }
    };
}

pub(crate) use choice;
