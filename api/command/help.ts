export const help = `Usage: dropwatt check FILE|- [options]   check a board document, print one JSON result
       dropwatt schema                    print the JSON Schema of the board document
       dropwatt --help

Options of check:
  --table            print tables for people instead of JSON
  --condition NAME   run this condition only; may be given several times
  --cell MM          cell size in mm (0.05 to 10); chosen from the board when left out
  --pdf FILE         also write the derating record as a PDF

Exit codes:
  0  everything within or close (or a board without regulators, whose heat was solved)
  1  something over its limit, or not evaluated: a missing input is never a pass
  2  the document or the command is not valid; every fault is listed with its path,
     as lines on standard error and as JSON on standard output
  3  no converged solution

Heat burns. The result is calculated: verify it by measurement before people or property
depend on it. Local codes and the judgement of a licensed engineer go before it.
`;
