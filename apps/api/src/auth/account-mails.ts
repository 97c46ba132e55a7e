import type { MailToSend } from '../mail/mail.service';
import { VALID_HOURS } from './mailed-tokens.service';

type Addressed = Pick<MailToSend, 'to' | 'subject' | 'text' | 'kind'>;

export function confirmAddressMail(to: string, publicUrl: string, token: string): Addressed {
  return {
    to,
    kind: 'email-confirm',
    subject: 'Confirm your address for Settlewright',
    text: lines(
      'Open this page to confirm that you read mail at this address:',
      `${publicUrl}/confirm/${token}`,
      `The link is good for ${VALID_HOURS['email-confirm']} hours and for one use.`,
      'If you did not sign up, leave it: nothing happens.',
    ),
  };
}

export function addressKnownMail(to: string, publicUrl: string): Addressed {
  return {
    to,
    kind: 'email-known',
    subject: 'You already have a Settlewright account',
    text: lines(
      'Somebody, perhaps you, wanted to use this address for another account. It stays with the one you have.',
      `Sign in: ${publicUrl}/sign-in`,
      `Password forgotten: ${publicUrl}/reset`,
    ),
  };
}

export function resetPasswordMail(to: string, publicUrl: string, token: string): Addressed {
  return {
    to,
    kind: 'password-reset',
    subject: 'A new password for Settlewright',
    text: lines(
      'Open this page to choose a new password:',
      `${publicUrl}/reset/${token}`,
      `The link is good for ${VALID_HOURS['password-reset']} hour and for one use.`,
      'If you did not ask for it, leave it: your password stays as it is.',
    ),
  };
}

export function passwordChangedMail(to: string, publicUrl: string): Addressed {
  return {
    to,
    kind: 'password-changed',
    subject: 'Your Settlewright password was changed',
    text: lines(
      'Your password was changed just now and all your sessions were ended.',
      `If that was not you, choose a new one at once: ${publicUrl}/reset`,
    ),
  };
}

export function changeAddressMail(to: string, publicUrl: string, token: string): Addressed {
  return {
    to,
    kind: 'email-change',
    subject: 'Confirm your new address for Settlewright',
    text: lines(
      'Open this page to use this address for your account from now on:',
      `${publicUrl}/confirm/${token}`,
      `The link is good for ${VALID_HOURS['email-change']} hours and for one use.`,
    ),
  };
}

export function addressChangedMail(to: string, newAddress: string, publicUrl: string): Addressed {
  return {
    to,
    kind: 'email-changed',
    subject: 'Your Settlewright address was changed',
    text: lines(
      `Your account now uses ${newAddress}. This address is no longer used.`,
      `If that was not you, write to the owner of your workshop. ${publicUrl}`,
    ),
  };
}

function lines(...paragraphs: string[]): string {
  return `${paragraphs.join('\n\n')}\n`;
}
