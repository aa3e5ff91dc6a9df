/** The text of `--help`. */
export const helpText = `Rail Ledger: voltage, ripple and pin budget of a board's auxiliary rails.

Usage
  rail-ledger check [FILE...]

Checks board files and prints a ledger for each: rails, pins, supplies and
findings, one finding on a line as

  file:line:column severity code message

Without FILE it takes the rails.yaml of the present folder or of the nearest
folder above it. The file - is standard input.

Options
  --format text|json       json prints the report with plain SI numbers: one
                           object for one file, a list for several
  --color auto|always|never
  --stdin-filename NAME    name to show for standard input
  --help, -h
  --version, -V

Exit code
  0  no finding of severity error
  1  at least one
  2  wrong use, or a file that cannot be read

Colour in auto: off when NO_COLOR is set, on when FORCE_COLOR is set, otherwise
on a terminal unless TERM is dumb.
`;
