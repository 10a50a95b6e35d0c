/** The SQLSTATE that a query is refused with; undefined when it is not refused. */
export async function refusal(query: Promise<unknown>): Promise<string | undefined> {
  try {
    await query;
    return undefined;
  } catch (error) {
    const { code } = error as { code?: string };
    return code ?? String(error);
  }
}

/** PostgreSQL's word for a right that the role does not have. */
export const NOT_GRANTED = '42501';
/** Ours, for what was approved and must stay as it was. */
export const APPROVED = 'HT001';
