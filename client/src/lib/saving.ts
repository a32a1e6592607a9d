/** How far what was typed has come. */
export type Saving =
  | { state: 'clean' }
  | { state: 'typing' }
  | { state: 'saving' }
  | { state: 'saved'; at: string }
  | { state: 'failed'; offline: boolean; error?: unknown }
  /** Somebody else saved meanwhile; a person has to choose. */
  | { state: 'stale'; current?: unknown };
