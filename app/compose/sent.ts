/** Where a form or a link of the page leads: a redirect, or for the live page the address as data. */
export function sent(request: Request, location: string): Response {
  const headers = { 'cache-control': 'no-store', vary: 'accept' }
  if (request.headers.get('accept') === 'application/json') return Response.json({ location }, { headers })
  return new Response(null, { status: 303, headers: { ...headers, location } })
}
