//! Pointers of the caller: handles, lists and places for results.

use crate::fault::Fault;
use std::ptr::NonNull;

/// The value behind a handle.
///
/// # Safety
/// The pointer is NULL or a handle of this type that has not been freed.
pub(crate) unsafe fn shared<'a, T>(pointer: *const T, parameter: &str) -> Result<&'a T, Fault> {
    // SAFETY: what is not NULL is a living handle, by this function's own contract.
    unsafe { pointer.as_ref() }.ok_or_else(|| Fault::null(parameter))
}

/// Frees a handle; NULL is nothing to free.
///
/// # Safety
/// The pointer is NULL or a handle of this type that has not been freed.
pub(crate) unsafe fn free<T>(pointer: *mut T) {
    if !pointer.is_null() {
        // SAFETY: every handle was made by `Slot::give` from a box.
        drop(unsafe { Box::from_raw(pointer) });
    }
}

/// A list of the caller; NULL will do where nothing is in it.
///
/// # Safety
/// The pointer is NULL or points to `count` values.
pub(crate) unsafe fn list<'a, T>(
    pointer: *const T,
    count: i32,
    parameter: &str,
) -> Result<&'a [T], Fault> {
    let length = usize::try_from(count).map_err(|_| {
        Fault::count(
            &format!("count of {parameter}"),
            i64::from(count),
            "a count that is not negative",
        )
    })?;
    if length == 0 {
        return Ok(&[]);
    }
    if pointer.is_null() {
        return Err(Fault::null(parameter));
    }
    // SAFETY: the pointer is not NULL and points to `count` values.
    Ok(unsafe { std::slice::from_raw_parts(pointer, length) })
}

/// The values behind a list of handles.
///
/// # Safety
/// The pointer is NULL or points to `count` pointers as [`shared`] takes them.
pub(crate) unsafe fn handles<'a, T>(
    pointer: *const *const T,
    count: i32,
    parameter: &str,
) -> Result<Vec<&'a T>, Fault> {
    // SAFETY: by this function's own contract.
    let pointers = unsafe { list(pointer, count, parameter)? };
    let value = |(index, pointer): (usize, &*const T)| {
        // SAFETY: by this function's own contract.
        unsafe { shared(*pointer, &format!("{parameter}[{index}]")) }
    };
    pointers.iter().enumerate().map(value).collect()
}

/// The element of an index given by the caller.
pub(crate) fn element<T>(list: &[T], index: i32) -> Result<&T, Fault> {
    usize::try_from(index)
        .ok()
        .and_then(|index| list.get(index))
        .ok_or_else(|| {
            let expected = format!("an index from 0 on and less than {}", list.len());
            Fault::count("index", i64::from(index), &expected)
        })
}

/// A length of a list as the ABI counts.
pub(crate) fn count(length: usize) -> Result<i32, Fault> {
    i32::try_from(length).map_err(|_| {
        let number = i64::try_from(length).unwrap_or(i64::MAX);
        Fault::count("count", number, "a count that an int32_t can hold")
    })
}

/// A place for one result.
pub(crate) struct Slot<T>(NonNull<T>);

impl<T> Slot<T> {
    /// The place behind a pointer.
    ///
    /// # Safety
    /// The pointer is NULL or may be written to as long as the slot lives.
    pub(crate) unsafe fn new(pointer: *mut T, parameter: &str) -> Result<Self, Fault> {
        NonNull::new(pointer)
            .map(Self)
            .ok_or_else(|| Fault::null(parameter))
    }

    /// Writes the result.
    pub(crate) fn put(self, value: T) {
        // SAFETY: the pointer may be written to, as was promised to `new`.
        unsafe { self.0.write(value) };
    }
}

impl<T> Slot<*mut T> {
    /// Hands a new handle to the caller, who frees it.
    pub(crate) fn give(self, value: T) {
        self.put(Box::into_raw(Box::new(value)));
    }
}

/// A place for as many results as the caller asked for.
pub(crate) struct Slots<T> {
    first: NonNull<T>,
    length: usize,
}

impl<T: Copy> Slots<T> {
    /// The place behind a pointer.
    ///
    /// # Safety
    /// The pointer is NULL or `length` values may be written to it as long as this lives.
    pub(crate) unsafe fn new(
        pointer: *mut T,
        length: usize,
        parameter: &str,
    ) -> Result<Self, Fault> {
        NonNull::new(pointer)
            .map(|first| Self { first, length })
            .ok_or_else(|| Fault::null(parameter))
    }

    /// Writes the results, as many as there is room for.
    pub(crate) fn put(self, values: &[T]) {
        let length = values.len().min(self.length);
        // SAFETY: `length` values may be written, as was promised to `new`; the values are in
        // memory of this library, apart from the caller's.
        unsafe { std::ptr::copy_nonoverlapping(values.as_ptr(), self.first.as_ptr(), length) };
    }
}
