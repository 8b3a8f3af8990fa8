import paperCss from './paper.css?inline';

const escaped = (text: string): string =>
  text.replaceAll('&', '&amp;').replaceAll('<', '&lt;').replaceAll('"', '&quot;');

/**
 * A page as one file that opens anywhere and asks nobody for anything: the policy in its head forbids every request.
 *
 * @param page Markup of the paper as it is on screen.
 */
export const standalonePage = (title: string, page: string): string => `<!doctype html>
<html lang="en">
<head>
<meta charset="utf-8">
<meta http-equiv="Content-Security-Policy" content="default-src 'none'; style-src 'unsafe-inline'">
<meta name="viewport" content="width=device-width">
<title>${escaped(title)}</title>
<style>
body { margin: 0; }
@media screen { body { background: #d9dcdd; } .paper { margin: 1rem auto; } }
${paperCss}
</style>
</head>
<body>
${page}
</body>
</html>
`;
