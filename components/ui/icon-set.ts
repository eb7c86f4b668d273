// Icon by icon: importing the whole set would put 3,700 drawings into the bundle.
import ArrowRight from 'lucide-react-native/icons/arrow-right';
import ArrowUp from 'lucide-react-native/icons/arrow-up';
import BriefcaseMedical from 'lucide-react-native/icons/briefcase-medical';
import Calculator from 'lucide-react-native/icons/calculator';
import Check from 'lucide-react-native/icons/check';
import ChevronLeft from 'lucide-react-native/icons/chevron-left';
import ChevronRight from 'lucide-react-native/icons/chevron-right';
import CircleCheck from 'lucide-react-native/icons/circle-check';
import CloudCheck from 'lucide-react-native/icons/cloud-check';
import CloudOff from 'lucide-react-native/icons/cloud-off';
import Copy from 'lucide-react-native/icons/copy';
import Download from 'lucide-react-native/icons/download';
import FileText from 'lucide-react-native/icons/file-text';
import Folders from 'lucide-react-native/icons/folders';
import Footprints from 'lucide-react-native/icons/footprints';
import Hand from 'lucide-react-native/icons/hand';
import Hourglass from 'lucide-react-native/icons/hourglass';
import Info from 'lucide-react-native/icons/info';
import Keyboard from 'lucide-react-native/icons/keyboard';
import Layers from 'lucide-react-native/icons/layers';
import Lock from 'lucide-react-native/icons/lock';
import LockOpen from 'lucide-react-native/icons/lock-open';
import Minus from 'lucide-react-native/icons/minus';
import MoveVertical from 'lucide-react-native/icons/move-vertical';
import OctagonAlert from 'lucide-react-native/icons/octagon-alert';
import PawPrint from 'lucide-react-native/icons/paw-print';
import Pencil from 'lucide-react-native/icons/pencil';
import Plus from 'lucide-react-native/icons/plus';
import Printer from 'lucide-react-native/icons/printer';
import RotateCw from 'lucide-react-native/icons/rotate-cw';
import Scissors from 'lucide-react-native/icons/scissors';
import Square from 'lucide-react-native/icons/square';
import Star from 'lucide-react-native/icons/star';
import Sun from 'lucide-react-native/icons/sun';
import Trash from 'lucide-react-native/icons/trash';
import TriangleAlert from 'lucide-react-native/icons/triangle-alert';
import Undo2 from 'lucide-react-native/icons/undo-2';
import UserRound from 'lucide-react-native/icons/user-round';
import UsersRound from 'lucide-react-native/icons/users-round';
import Volume2 from 'lucide-react-native/icons/volume-2';
import X from 'lucide-react-native/icons/x';

/** The icons that come from Lucide, by the name they go by here. */
export const lucide = {
  back: ChevronLeft,
  plus: Plus,
  minus: Minus,
  undo: Undo2,
  keypad: Calculator,
  scissors: Scissors,
  check: Check,
  done: CircleCheck,
  chevron: ChevronRight,
  sun: Sun,
  lock: Lock,
  unlock: LockOpen,
  firstAid: BriefcaseMedical,
  layers: Layers,
  keyboard: Keyboard,
  star: Star,
  triangle: TriangleAlert,
  octagon: OctagonAlert,
  info: Info,
  cloudOff: CloudOff,
  cloudCheck: CloudCheck,
  ready: Sun,
  projects: Folders,
  me: UserRound,
  hourglass: Hourglass,
  arrowRight: ArrowRight,
  arrowUp: ArrowUp,
  hand: Hand,
  shoes: Footprints,
  paw: PawPrint,
  mat: Square,
  height: MoveVertical,
  people: UsersRound,
  printer: Printer,
  copy: Copy,
  trash: Trash,
  pencil: Pencil,
  download: Download,
  refresh: RotateCw,
  file: FileText,
  volume: Volume2,
  close: X,
};
export type LucideName = keyof typeof lucide;
