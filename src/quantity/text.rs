//! Numbers as people read them.

/// The shortest text that reads back as the number, with an exponent where it would be long.
pub fn number_text(value: f64) -> String {
    if value == 0.0 || (1e-5..1e16).contains(&value.abs()) {
        value.to_string()
    } else {
        format!("{value:e}")
    }
}

#[cfg(test)]
mod tests {
    use super::number_text;

    #[test]
    fn long_numbers_have_exponents() {
        assert_eq!(number_text(0.0), "0");
        assert_eq!(number_text(-0.25), "-0.25");
        assert_eq!(number_text(3826228.5), "3826228.5");
        assert_eq!(number_text(5e-324), "5e-324");
        assert_eq!(number_text(-1e300), "-1e300");
    }
}
