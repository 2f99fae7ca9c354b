//! Filled in below.
