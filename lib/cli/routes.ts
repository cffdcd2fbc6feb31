/** `waypost routes`: where men belong and how they get there, or the check of a given route. */
import { routeCheckSchema, routesAnswerSchema } from '@/engine/reading/schema/routes';
import { SIDES } from '@/engine/types';
import { jsonWriter } from '@/lib/api/writer';
import { checkGivenRoute } from '@/lib/services/routes/check-given-route';
import { findRoutes } from '@/lib/services/routes/find-routes';
import { ROUTE_CHOICES_MAX, ROUTE_MOVES_MAX, routesRequestSchema } from '@/openapi/schemas/routes';
import { choiceOf, commandArguments, countOf, fenOf } from './arguments';
import { inkFor } from './ink';
import { answerLines, type BadAnswer } from './lines';
import { checkText, routesText } from './routes-text';
import { answered, refused } from './refused';
import { EXIT, type ExitCode, type Terminal, written } from './terminal';
import { UsageError } from './usage-error';

export const ROUTES_HELP = `waypost routes "<FEN>" [--man f3] [--side white|black] [--moves 4] [--most 12]
waypost routes "<FEN>" --check "f3 d2 b3"
waypost routes -       FENs from standard input, one a line

Ranks the posts of a man, or of all men of a side, with the safe ways there,
what must be prepared and who can dispute them. With --check it gives a
verdict for each step of a route: squares, the man's own first, or moves in SAN.

  --man SQUARE      one knight, bishop, rook or queen only
  --side SIDE       whose men; the side to move unless said
  --moves N         the longest route, 1 to ${ROUTE_MOVES_MAX} (4 unless said)
  --most N          the most choices, 1 to ${ROUTE_CHOICES_MAX} (12 unless said)
  --json            the whole answer as JSON, on one line

Exit codes: 0 done, and a checked route holds; 1 refused, or a checked route
fails; 2 the command was not understood.
`;

const OPTIONS = {
  man: { type: 'string' },
  side: { type: 'string' },
  moves: { type: 'string' },
  most: { type: 'string' },
  check: { type: 'string' },
  json: { type: 'boolean' },
  help: { type: 'boolean', short: 'h' },
} as const;

const routesJson = jsonWriter(routesAnswerSchema);
const checkJson = jsonWriter(routeCheckSchema);

/** Runs the command on its arguments, without the word "routes". */
export async function runRoutes(args: readonly string[], terminal: Terminal): Promise<ExitCode> {
  const { positionals, values } = commandArguments(args, OPTIONS);
  if (values.help) {
    await written(terminal.output, ROUTES_HELP);
    return EXIT.good;
  }
  const choices = {
    man: values.man,
    side: choiceOf('side', values.side, SIDES),
    movesMax: countOf('moves', values.moves, ROUTE_MOVES_MAX),
    choicesMax: countOf('most', values.most, ROUTE_CHOICES_MAX),
  };
  const fen = fenOf(positionals);
  const request = (text: string) => requestOf({ fen: text, ...choices });
  if (fen === '-') return answerLines(terminal, (text) => answered(() => findRoutes(request(text))), lineJson);
  const ink = inkFor(terminal.colour);
  return refused(terminal, async () => {
    if (values.check === undefined) {
      const answer = findRoutes(request(fen));
      await written(terminal.output, values.json ? `${routesJson(answer)}\n` : routesText(answer, ink));
      return EXIT.good;
    }
    const check = checkGivenRoute({ fen, route: values.check.split(/[\s,]+/).filter((word) => word !== '') });
    await written(terminal.output, values.json ? `${checkJson(check)}\n` : checkText(check, ink));
    return check.holds ? EXIT.good : EXIT.fault;
  });
}

function requestOf(given: { readonly [field: string]: unknown }) {
  const parsed = routesRequestSchema.safeParse(given);
  if (parsed.success) return parsed.data;
  const [issue] = parsed.error.issues;
  throw new UsageError(`--${String(issue?.path[0] ?? 'fen')}: ${issue?.message ?? 'not understood'}`);
}

function lineJson(value: ReturnType<typeof findRoutes> | BadAnswer): string {
  return `${'error' in value ? JSON.stringify(value) : routesJson(value)}\n`;
}
