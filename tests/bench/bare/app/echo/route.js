/** Reads the JSON of a body and answers JSON: no check, no database. */
export async function POST(request) {
  const body = await request.json();
  return Response.json({ read: Object.keys(body).length });
}

export const dynamic = 'force-dynamic';
export const GET = () => Response.json({ rows: [] });
