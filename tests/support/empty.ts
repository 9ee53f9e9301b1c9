// Stands in for the package `server-only`, which throws when a test runner (neither server nor browser bundle) loads it.
export {};
