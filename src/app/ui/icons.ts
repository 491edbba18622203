import accountCircle from '@material-symbols/svg-400/rounded/account_circle.svg';
import add from '@material-symbols/svg-400/rounded/add.svg';
import arrowBack from '@material-symbols/svg-400/rounded/arrow_back.svg';
import arrowDownward from '@material-symbols/svg-400/rounded/arrow_downward.svg';
import arrowForward from '@material-symbols/svg-400/rounded/arrow_forward.svg';
import arrowUpward from '@material-symbols/svg-400/rounded/arrow_upward.svg';
import block from '@material-symbols/svg-400/rounded/block.svg';
import check from '@material-symbols/svg-400/rounded/check.svg';
import chevronRight from '@material-symbols/svg-400/rounded/chevron_right.svg';
import close from '@material-symbols/svg-400/rounded/close.svg';
import contentCopy from '@material-symbols/svg-400/rounded/content_copy.svg';
import darkMode from '@material-symbols/svg-400/rounded/dark_mode.svg';
import deleteIcon from '@material-symbols/svg-400/rounded/delete.svg';
import download from '@material-symbols/svg-400/rounded/download.svg';
import edit from '@material-symbols/svg-400/rounded/edit.svg';
import error from '@material-symbols/svg-400/rounded/error.svg';
import expandMore from '@material-symbols/svg-400/rounded/stat_minus_1.svg';
import history from '@material-symbols/svg-400/rounded/history.svg';
import hourglassTop from '@material-symbols/svg-400/rounded/hourglass_top.svg';
import info from '@material-symbols/svg-400/rounded/info.svg';
import inventory from '@material-symbols/svg-400/rounded/inventory_2.svg';
import lightMode from '@material-symbols/svg-400/rounded/light_mode.svg';
import localShipping from '@material-symbols/svg-400/rounded/local_shipping.svg';
import logout from '@material-symbols/svg-400/rounded/logout.svg';
import mail from '@material-symbols/svg-400/rounded/mail.svg';
import moreVert from '@material-symbols/svg-400/rounded/more_vert.svg';
import openInNew from '@material-symbols/svg-400/rounded/open_in_new.svg';
import pause from '@material-symbols/svg-400/rounded/pause.svg';
import pictureAsPdf from '@material-symbols/svg-400/rounded/picture_as_pdf.svg';
import precisionManufacturing from '@material-symbols/svg-400/rounded/precision_manufacturing.svg';
import receiptLong from '@material-symbols/svg-400/rounded/receipt_long.svg';
import refresh from '@material-symbols/svg-400/rounded/refresh.svg';
import schedule from '@material-symbols/svg-400/rounded/schedule.svg';
import search from '@material-symbols/svg-400/rounded/search.svg';
import send from '@material-symbols/svg-400/rounded/send.svg';
import shoppingCart from '@material-symbols/svg-400/rounded/shopping_cart.svg';
import swapHoriz from '@material-symbols/svg-400/rounded/swap_horiz.svg';
import taskAlt from '@material-symbols/svg-400/rounded/task_alt.svg';
import undo from '@material-symbols/svg-400/rounded/undo.svg';
import warning from '@material-symbols/svg-400/rounded/warning.svg';

/** The icons the product uses, as SVG text; each shipped with the application. */
export const icons = {
  account_circle: accountCircle,
  add,
  arrow_back: arrowBack,
  arrow_downward: arrowDownward,
  arrow_forward: arrowForward,
  arrow_upward: arrowUpward,
  block,
  check,
  chevron_right: chevronRight,
  close,
  content_copy: contentCopy,
  dark_mode: darkMode,
  delete: deleteIcon,
  download,
  edit,
  error,
  expand_more: expandMore,
  history,
  hourglass_top: hourglassTop,
  info,
  inventory_2: inventory,
  light_mode: lightMode,
  local_shipping: localShipping,
  logout,
  mail,
  more_vert: moreVert,
  open_in_new: openInNew,
  pause,
  picture_as_pdf: pictureAsPdf,
  precision_manufacturing: precisionManufacturing,
  receipt_long: receiptLong,
  refresh,
  schedule,
  search,
  send,
  shopping_cart: shoppingCart,
  swap_horiz: swapHoriz,
  task_alt: taskAlt,
  undo,
  warning,
} as const;

export type IconName = keyof typeof icons;
