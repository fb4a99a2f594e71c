package org.foreseal.cli;

/** How a result is written. */
enum OutputFormat {
  TEXT,
  CSV,
  JSON
}
