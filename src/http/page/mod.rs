//! Pages for people.

mod docs;
mod front;

pub use docs::docs;
pub use front::front;

use maud::{DOCTYPE, Markup, PreEscaped, html};

/// The icon: a warm surface and the plume above it.
pub const ICON: &str = include_str!("icon.svg");

const STYLE: &str = include_str!("style.css");

/// The frame of every page.
fn frame(title: &str, content: Markup) -> String {
    html! {
        (DOCTYPE)
        html lang="en" {
            head {
                meta charset="utf-8";
                meta name="viewport" content="width=device-width, initial-scale=1";
                title { (title) }
                link rel="icon" type="image/svg+xml" href="/favicon.ico";
                style { (PreEscaped(STYLE)) }
            }
            body { main { (content) } }
        }
    }
    .into_string()
}
