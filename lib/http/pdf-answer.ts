/** A PDF to look at in the browser, under a name for whoever keeps it. */
export function pdfAnswer(bytes: Buffer, name: string): Response {
  return new Response(new Uint8Array(bytes), {
    headers: {
      'Content-Type': 'application/pdf',
      'Content-Disposition': `inline; filename="${name}.pdf"`,
      'Cache-Control': 'no-store',
    },
  })
}
