/** For `vi.waitFor`: no test is about speed, and a busy machine may take this long. */
export const patience = { timeout: 20_000 }
