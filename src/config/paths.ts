/** Every address of the client, in one table. */
export const paths = {
  boards: () => '/',
  signIn: () => '/sign-in',
  forgotten: () => '/reset',
  reset: (token: string) => `/reset/${token}`,
  invitation: (token: string) => `/invitation/${token}`,
  newBoard: () => '/boards/new',
  board: (boardId: string) => `/boards/${boardId}`,
  boardPeople: (boardId: string) => `/boards/${boardId}/people`,
  newRail: (boardId: string) => `/boards/${boardId}/rails/new`,
  bench: (boardId: string, railId: string) => `/boards/${boardId}/rails/${railId}`,
  specification: (boardId: string, railId: string) => `/boards/${boardId}/rails/${railId}/specification`,
  revisions: (boardId: string) => `/boards/${boardId}/revisions`,
  revision: (boardId: string, letter: string) => `/boards/${boardId}/revisions/${letter}`,
  placement: (boardId: string, letter?: string) =>
    `/boards/${boardId}/placement${letter ? `?revision=${letter}` : ''}`,
  parts: () => '/parts',
  newPart: () => '/parts/new',
  part: (partId: string) => `/parts/${partId}`,
  people: () => '/people',
  mail: () => '/mail',
  account: () => '/account',
} as const;
