import { theme, type ThemeConfig } from 'antd';
import { NIGHT, PAPER } from './palette';

export const SERIF = "'Source Serif 4', 'Source Serif Pro', Georgia, 'DejaVu Serif', serif";

/** Ant Design in the inks of the identity: square-ish, hairline borders, no shadows. */
export function antdTheme(night: boolean): ThemeConfig {
  const inks = night ? NIGHT : PAPER;
  return {
    algorithm: night ? theme.darkAlgorithm : theme.defaultAlgorithm,
    cssVar: { key: 'merestone' },
    token: {
      fontFamily: SERIF,
      fontSize: 16,
      lineHeight: 1.5,
      borderRadius: 2,
      borderRadiusLG: 2,
      borderRadiusSM: 2,
      borderRadiusXS: 1,
      wireframe: true,
      controlHeight: 38,
      controlHeightSM: 28,
      colorPrimary: inks.lichen,
      colorInfo: inks.slate,
      colorLink: inks.slate,
      colorLinkHover: inks.ink,
      colorLinkActive: inks.ink,
      colorSuccess: inks.lichen,
      colorWarning: inks.ochre,
      colorError: inks.madder,
      colorBgBase: inks.paper,
      colorTextBase: inks.ink,
      colorText: inks.ink,
      colorTextSecondary: inks.faded,
      colorTextTertiary: inks.faded,
      colorTextDescription: inks.faded,
      colorTextPlaceholder: inks.faded,
      colorBgLayout: inks.paper,
      colorBgContainer: inks.raised,
      colorBgElevated: inks.raised,
      colorBorder: inks.outline,
      colorBorderSecondary: inks.rule,
      colorSplit: inks.rule,
      colorTextLightSolid: inks.onLichen,
      boxShadow: 'none',
      boxShadowSecondary: 'none',
      boxShadowTertiary: 'none',
      motionDurationMid: '0.1s',
      motionDurationSlow: '0.15s',
    },
    components: {
      Button: { primaryShadow: 'none', defaultShadow: 'none', dangerShadow: 'none', defaultBg: inks.raised },
      Input: { activeShadow: 'none', errorActiveShadow: 'none', warningActiveShadow: 'none' },
      Select: { optionSelectedBg: inks.paper, activeOutlineColor: 'transparent' },
    },
  };
}
