/** Stands in for a marker that only a bundler reads. */
export {}
