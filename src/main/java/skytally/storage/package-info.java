/**
 * Knows the data directory: who may read it, that one copy of the tool uses it at a time, and what state its database is in.
 * Does not know what is kept in the database, or who asks for it.
 * Units: bytes and files; times are UTC.
 */
@NullMarked
package skytally.storage;

import org.jspecify.annotations.NullMarked;
