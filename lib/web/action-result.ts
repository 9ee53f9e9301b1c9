/** What a server action answers: the data, or what went wrong in words for the person, with fields by input path. */
export type ActionResult<T> =
  | { ok: true; data: T }
  | {
      ok: false;
      error: { code: string; message: string; fields: Record<string, string>; requestId: string };
    };

/** A server action of a league as a component takes it: the league's slug first, then what is asked. */
export type LeagueAction<Input, Data> = (league: string, input: Input) => Promise<ActionResult<Data>>;
