/** Attributes of WAI-ARIA and HTML that react-native-web hands on but React Native's types leave out. */
export interface Aria {
  'aria-level'?: number;
  'aria-invalid'?: boolean;
  'aria-required'?: boolean;
  'aria-describedby'?: string;
  'aria-current'?: 'page' | 'step' | 'true';
  'aria-controls'?: string;
  'aria-haspopup'?: 'dialog' | 'menu' | 'listbox';
  dataSet?: Record<string, string>;
}

/** To be spread into a React Native element: `<View {...aria({ 'aria-invalid': true })} />`. */
export const aria = (attributes: Aria): object => attributes;
