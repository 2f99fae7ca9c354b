//! Which of a body's ways to give its size a case uses, and what is wrong with it.

use crate::geometry::{DIMENSIONS, Field, Geometry, SizeForm};

use super::fault::Fault;
use super::fields::Fields;

/// The form that the given dimensions come closest to.
pub(super) fn choose_form(geometry: Geometry, fields: &Fields) -> &'static SizeForm {
    let forms = geometry.entry().forms;
    let distance = |form: &&SizeForm| {
        let missing = form
            .required
            .iter()
            .filter(|&&field| !fields.is_given(field));
        missing.count() + unexpected(form, fields).count()
    };
    // Every body has at least one form; the first wins a tie.
    forms.iter().min_by_key(distance).unwrap_or(&forms[0])
}

fn unexpected(form: &SizeForm, fields: &Fields) -> impl Iterator<Item = Field> {
    DIMENSIONS.iter().copied().filter(move |field| {
        fields.is_given(*field) && !form.required.contains(field) && !form.optional.contains(field)
    })
}

pub(super) fn report(
    geometry: Geometry,
    form: &SizeForm,
    fields: &Fields,
    faults: &mut Vec<Fault>,
) {
    for &field in form
        .required
        .iter()
        .filter(|&&field| !fields.is_given(field))
    {
        faults.push(Fault::at(
            field,
            "missing-field",
            format!(
                "{} is not given; {} takes {}",
                field.name(),
                geometry.as_str(),
                forms_in_words(geometry)
            ),
        ));
    }
    for field in unexpected(form, fields) {
        faults.push(Fault::at(
            field,
            "unexpected-field",
            format!(
                "{} does not belong here; {} takes {}",
                field.name(),
                geometry.as_str(),
                forms_in_words(geometry)
            ),
        ));
    }
    let mut optional = form
        .optional
        .iter()
        .filter(|&&field| fields.is_given(field));
    if let (Some(first), Some(second)) = (optional.next(), optional.next()) {
        faults.push(Fault::at(
            *second,
            "conflicting-fields",
            format!(
                "{} and {} are both given; give one",
                first.name(),
                second.name()
            ),
        ));
    }
}

/// The ways to give a body's size, as a sentence's end.
pub fn forms_in_words(geometry: Geometry) -> String {
    let names = |fields: &[Field], joint: &str| {
        fields
            .iter()
            .map(|field| field.name())
            .collect::<Vec<_>>()
            .join(joint)
    };
    let one = |form: &SizeForm| match form.optional {
        [] => names(form.required, ", "),
        optional => format!(
            "{} [{}]",
            names(form.required, ", "),
            names(optional, " or ")
        ),
    };
    geometry
        .entry()
        .forms
        .iter()
        .map(one)
        .collect::<Vec<_>>()
        .join("; or ")
}
