/** The five characters that PostgreSQL names an error by, wherever the libraries above have put them. */
export function postgresCode(error: unknown): string | undefined {
  if (typeof error !== 'object' || error === null) return undefined;
  const { driverError, code } = error as { driverError?: unknown; code?: unknown };
  if (driverError !== undefined && driverError !== error) return postgresCode(driverError);
  return typeof code === 'string' ? code : undefined;
}
