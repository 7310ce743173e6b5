//! What a JSON schema asks of a value, as far as the schemas of the job use the language.
//!
//! Read are: `$ref`, `type`, `properties`, `required`, `additionalProperties`, `items`,
//! `prefixItems`, `minItems`, `maxItems`, `enum` and `const` of texts, `oneOf`, `anyOf`, the bounds
//! and formats of numbers, `description`, and the extension `x-quantity` for a text that holds a
//! number with its unit. Anything else asks nothing here.

use serde_json::{Map, Value};

use super::words;

/// A schema within the document of schemas that its references point into.
#[derive(Clone, Copy)]
pub(super) struct Schema<'s> {
    root: &'s Value,
    here: &'s Value,
}

/// What a schema asks.
pub(super) enum Shape<'s> {
    /// Nothing.
    Any,
    /// A text that holds a quantity of this type.
    Quantity(&'s str),
    /// A text.
    Text,
    /// A number, whole or not.
    Number,
    /// A whole number.
    Integer,
    /// True or false.
    Bool,
    /// A list.
    List(List<'s>),
    /// A table.
    Table(Table<'s>),
    /// One of several.
    Choice(Choice<'s>),
}

/// What is asked of a list.
pub(super) struct List<'s> {
    first: Vec<Schema<'s>>,
    rest: Option<Schema<'s>>,
    /// The least number of elements.
    pub(super) least: Option<u64>,
    /// The greatest number of elements.
    pub(super) most: Option<u64>,
}

impl<'s> List<'s> {
    /// The schema of the element at an index, if it has one.
    pub(super) fn element(&self, index: usize) -> Option<Schema<'s>> {
        self.first.get(index).copied().or(self.rest)
    }
}

/// What is asked of a table.
pub(super) struct Table<'s> {
    /// The keys that are known, with the schemas of their values.
    pub(super) keys: Vec<(&'s str, Schema<'s>)>,
    /// The keys that must be there.
    pub(super) required: Vec<&'s str>,
    /// What other keys there may be.
    pub(super) others: Others<'s>,
}

/// Keys of a table that are not known by name.
pub(super) enum Others<'s> {
    /// None: any other key is a mistake.
    Refused,
    /// Any: the table is a map of named things.
    Named(Schema<'s>),
    /// Any, with any value.
    Free,
}

/// What is asked of a value that may be one of several.
#[derive(Default)]
pub(super) struct Choice<'s> {
    /// Fixed texts.
    pub(super) words: Vec<&'s str>,
    /// Tables of exactly one key: the key, and the schema of its value.
    pub(super) variants: Vec<(&'s str, Schema<'s>)>,
    /// Other values.
    pub(super) others: Vec<Schema<'s>>,
}

impl<'s> Schema<'s> {
    /// The outermost schema of a document of schemas.
    pub(super) const fn new(root: &'s Value) -> Self {
        Self { root, here: root }
    }

    const fn at(self, here: &'s Value) -> Self {
        Self { here, ..self }
    }

    fn text(self, key: &str) -> Option<&'s str> {
        self.here.get(key)?.as_str()
    }

    fn list(self, key: &str) -> Option<impl Iterator<Item = Self>> {
        Some(
            self.here
                .get(key)?
                .as_array()?
                .iter()
                .map(move |here| self.at(here)),
        )
    }

    fn words(self, key: &str) -> Vec<&'s str> {
        let texts = |list: &'s Vec<Value>| list.iter().filter_map(Value::as_str).collect();
        self.here
            .get(key)
            .and_then(Value::as_array)
            .map(texts)
            .unwrap_or_default()
    }

    /// The schema that this one refers to.
    fn referred(self) -> Option<Self> {
        let pointer = self.text("$ref")?.strip_prefix('#')?;
        self.root.pointer(pointer).map(|here| self.at(here))
    }

    /// The one schema that this one stands for: what it refers to, or what is optional.
    fn behind(self) -> Option<Self> {
        self.referred().or_else(|| {
            let mut given = self
                .list("anyOf")?
                .filter(|each| each.text("type") != Some("null"));
            let only = given.next()?;
            given.next().is_none().then_some(only)
        })
    }

    /// The type, leaving aside null for a value that may be left out.
    fn kind(self) -> Option<&'s str> {
        let kind = self.here.get("type")?;
        kind.as_str().or_else(|| {
            let mut given = kind.as_array()?.iter().filter_map(Value::as_str);
            let only = given.find(|&each| each != "null")?;
            given.all(|each| each == "null").then_some(only)
        })
    }

    /// The first sentence of the description, to follow after "expected".
    pub(super) fn sentence(self) -> Option<String> {
        let Some(text) = self.text("description") else {
            return self.behind().and_then(Self::sentence);
        };
        words::first_sentence(text)
    }

    /// What is asked.
    pub(super) fn shape(self) -> Shape<'s> {
        if let Some(quantity) = self.text("x-quantity") {
            return Shape::Quantity(quantity);
        }
        if let Some(schema) = self.behind() {
            return schema.shape();
        }
        let mut choice = Choice::default();
        self.gather(&mut choice);
        if !choice.is_empty() {
            return Shape::Choice(choice);
        }
        match self.kind() {
            Some("string") => Shape::Text,
            Some("number") => Shape::Number,
            Some("integer") => Shape::Integer,
            Some("boolean") => Shape::Bool,
            Some("array") => Shape::List(self.array()),
            Some("object") => Shape::Table(self.object()),
            _ => Shape::Any,
        }
    }

    /// Adds what this schema offers to a choice, if it is a choice itself.
    fn gather(self, choice: &mut Choice<'s>) {
        choice.words.extend(self.text("const"));
        choice.words.extend(self.words("enum"));
        for each in self.list("oneOf").into_iter().flatten() {
            match each.variant() {
                Some(variant) => choice.variants.push(variant),
                None => each.offer(choice),
            }
        }
        self.list("anyOf")
            .into_iter()
            .flatten()
            .for_each(|each| each.offer(choice));
    }

    /// Adds this schema to a choice as one of the things to choose from.
    fn offer(self, choice: &mut Choice<'s>) {
        if self.text("x-quantity").is_none() {
            if let Some(schema) = self.behind() {
                return schema.offer(choice);
            }
            let before = choice.len();
            self.gather(choice);
            if choice.len() > before || self.kind() == Some("null") {
                return;
            }
        }
        choice.others.push(self);
    }

    /// The key and the schema of its value, if this asks for a table of exactly one key.
    fn variant(self) -> Option<(&'s str, Self)> {
        let table = self.object();
        match (&*table.keys, &*table.required, table.others) {
            (&[(key, value)], &[required], Others::Refused) if key == required => {
                Some((key, value))
            }
            _ => None,
        }
    }

    fn object(self) -> Table<'s> {
        let keys = |keys: &'s Map<String, Value>| {
            keys.iter()
                .map(|(key, here)| (&**key, self.at(here)))
                .collect()
        };
        let others = match self.here.get("additionalProperties") {
            Some(Value::Bool(false)) => Others::Refused,
            Some(here @ Value::Object(_)) => Others::Named(self.at(here)),
            _ => Others::Free,
        };
        let properties = self.here.get("properties").and_then(Value::as_object);
        let keys = properties.map(keys).unwrap_or_default();
        Table {
            keys,
            required: self.words("required"),
            others,
        }
    }

    fn array(self) -> List<'s> {
        let size = |key| self.here.get(key).and_then(Value::as_u64);
        List {
            first: self.list("prefixItems").into_iter().flatten().collect(),
            rest: self.here.get("items").map(|here| self.at(here)),
            least: size("minItems"),
            most: size("maxItems"),
        }
    }

    /// The bounds that `number` breaks, in words: `of at least 0`.
    pub(super) fn broken_bound(self, number: f64) -> Option<String> {
        if let Some(schema) = self.behind() {
            return schema.broken_bound(number);
        }
        let bound = |key| self.here.get(key).and_then(Value::as_f64);
        let (low, high) = match self.text("format") {
            Some("uint32") => (Some(0.0), Some(f64::from(u32::MAX))),
            Some("int32") => (Some(f64::from(i32::MIN)), Some(f64::from(i32::MAX))),
            _ => (None, None),
        };
        let least = bound("minimum").or(low).filter(|&least| number < least);
        let most = bound("maximum").or(high).filter(|&most| number > most);
        let above = bound("exclusiveMinimum").filter(|&above| number <= above);
        let below = bound("exclusiveMaximum").filter(|&below| number >= below);
        (least.map(|least| format!("of at least {least}")))
            .or_else(|| most.map(|most| format!("of at most {most}")))
            .or_else(|| above.map(|above| format!("above {above}")))
            .or_else(|| below.map(|below| format!("below {below}")))
    }
}

impl Choice<'_> {
    fn len(&self) -> usize {
        self.words.len() + self.variants.len() + self.others.len()
    }

    fn is_empty(&self) -> bool {
        self.len() == 0
    }
}
