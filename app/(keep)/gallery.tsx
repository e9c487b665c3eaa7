import { GalleryScreen } from '@/components/gallery/GalleryScreen';

export default GalleryScreen;
