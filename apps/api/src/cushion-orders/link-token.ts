const TOKEN_FORM = /^[A-Za-z0-9_-]{43}$/;

const LINK_DAYS = 60;

export function isLinkToken(text: string): boolean {
  return TOKEN_FORM.test(text);
}

export function linkExpiry(from: Date): Date {
  return new Date(from.getTime() + LINK_DAYS * 24 * 3600 * 1000);
}
