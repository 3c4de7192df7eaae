const systemFolders = ["/usr/share/fonts", "/usr/local/share/fonts"];

/**
 * A fontconfig file. Without any configuration the headless browser prints pages that hold no text
 * at all, and reports no error.
 */
export function fontConfiguration({ fonts, cache }: { fonts: string; cache: string }): string {
  const dirs = [fonts, ...systemFolders].map((folder) => `  <dir>${escapeXml(folder)}</dir>`);
  return [
    `<?xml version="1.0"?>`,
    `<!DOCTYPE fontconfig SYSTEM "urn:fontconfig:fonts.dtd">`,
    `<fontconfig>`,
    ...dirs,
    `  <cachedir>${escapeXml(cache)}</cachedir>`,
    `</fontconfig>`,
    ``,
  ].join("\n");
}

const escapeXml = (text: string): string =>
  text.replace(/&/g, "&amp;").replace(/</g, "&lt;").replace(/>/g, "&gt;");
