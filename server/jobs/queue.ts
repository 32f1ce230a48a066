/** Starts taking jobs from the table. */
export function startJobs() {}

/** Finishes the job in hand and takes no more. */
export async function stopJobs() {}
