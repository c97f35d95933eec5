import type { Message } from "./mailer.ts";

/** The words of every message the product sends, in English. */

type Words = Omit<Message, "to">;
const signature = (companyName: string) => `\n\n${companyName}\nSent by Emberladder.\n`;

export function inviteMessage(facts: {
  name: string;
  companyName: string;
  link: string;
  days: number;
}): Words {
  return {
    subject: `${facts.companyName} invites you to Emberladder`,
    text: `Hello ${facts.name},

${facts.companyName} records its furnace calls with Emberladder and has made an account for you.
Choose a password here. The link works once, for ${facts.days} days:

${facts.link}

If you did not expect this, do nothing.${signature(facts.companyName)}`,
  };
}

export function resetMessage(facts: {
  name: string;
  companyName: string;
  link: string;
  hours: number;
}): Words {
  return {
    subject: "Choose a new password",
    text: `Hello ${facts.name},

somebody asked for a new password for your account. Choose one here. The link works once, for ${facts.hours} hour:

${facts.link}

If it was not you, do nothing: your password stays as it is.${signature(facts.companyName)}`,
  };
}

export function callAssignedMessage(facts: {
  name: string;
  companyName: string;
  callNumber: number;
  when: string;
  customerFirstName: string;
  address: string;
  complaint: string;
  link: string;
}): Words {
  return {
    subject: `Call ${facts.callNumber} is yours: ${facts.when}`,
    text: `Hello ${facts.name},

call ${facts.callNumber} was assigned to you.

When: ${facts.when}
Where: ${facts.customerFirstName}, ${facts.address}
Complaint: ${facts.complaint}

${facts.link}${signature(facts.companyName)}`,
  };
}

export function reportMessage(facts: {
  customerFirstName: string;
  companyName: string;
  visited: string;
  safe: string;
  link: string;
  until: string;
  isDemo: boolean;
}): Words {
  return {
    subject: `${facts.isDemo ? "[Demo] " : ""}Your furnace: what was found and done`,
    text: `Hello ${facts.customerFirstName},

here is the report of our visit on ${facts.visited}: what was found, what was done, what was measured, and what comes next.

${facts.link}

${facts.safe}

The link is private and works until ${facts.until}. You need no account.
If you smell gas, or anyone feels unwell: leave the building and call from outside.${signature(facts.companyName)}`,
  };
}
