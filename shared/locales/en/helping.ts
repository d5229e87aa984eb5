/** English texts of helping: somebody types for an elder. */
export const texts = {
  title: 'Help somebody',
  lead: 'You type, they speak. Everything you write is theirs, and says that you typed it. It ends when you press Done, at the latest after {{count}} minutes. Nobody signs a calendar for somebody else.',
  whom: 'Whom do you help?',
  choose: 'Choose whom you help.',
  card: 'Letters on their card',
  cardHint: 'Their card lies beside you: eighteen letters and numbers under its squares.',
  pin: 'Their PIN',
  pinMust: 'They type it themselves: then you see what they see.',
  pinMay:
    'They type it themselves: then you see what they see. Without it you see what you see, and every answer asks for their PIN or their voice.',
  begin: 'Begin',
  label: 'You are helping',
  typing: 'You are typing for {{name}}.',
  typingBlind: 'You are typing for {{name}}. You see what you see yourself.',
  done: 'Done',
  ask: {
    title: '{{name}} agrees themselves',
    lead: '{{name}} types their PIN here, for this one thing.',
    give: 'It is theirs: go on',
  },
} as const;
