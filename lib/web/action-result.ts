/** What a server action answers: the data, or what went wrong in words for the person, with fields by input path. */
export type ActionResult<T> =
  | { ok: true; data: T }
  | {
      ok: false;
      error: { code: string; message: string; fields: Record<string, string>; requestId: string };
    };
