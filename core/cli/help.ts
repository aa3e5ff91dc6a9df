/** The text of `--help`. */
export const helpText = `Rail Ledger: voltage, ripple and pin budget of a board's auxiliary rails.

Usage
  rail-ledger check [FILE...]
  rail-ledger size RAIL [FILE] [--write]
  rail-ledger yield [FILE] [--samples N] [--seed S]
  rail-ledger explain [CODE]

check: checks board files and prints a ledger for each: rails, pins, supplies and
findings, one finding on a line as

  file:line:column severity code message

Without FILE it takes the rails.yaml of the present folder or of the nearest
folder above it. The file - is standard input.

size: finds ways to make a rail that meets its needs, with the parts that the board's
stock allows; --write puts the first one into the file.

yield: draws boards by lot within the tolerances of their parts, solves each in
every mode and counts how many meet their needs. The same seed draws the same
boards.

explain: prints the page of a finding: cause, figures, cure and an example; without
CODE a list of all findings.

Options
  --format text|json       json prints the report with plain SI numbers: one
                           object for one file, a list for several
  --color auto|always|never
  --stdin-filename NAME    name to show for standard input
  --write                  put the first way of size into the file
  --samples N              boards that yield draws (1000)
  --seed S                 a whole number (1)
  --distribution uniform|triangular
                           within each tolerance: all values alike (cautious),
                           or the typical one likeliest
  --help, -h
  --version, -V

Exit code
  0  no finding of severity error; size: a way was found; yield: every sample met
     every need
  1  at least one; size: none was found; yield: a sample missed a need, or could
     not be judged
  2  wrong use, or a file that cannot be read

Colour in auto: off when NO_COLOR is set, on when FORCE_COLOR is set, otherwise
on a terminal unless TERM is dumb.
`;
