import { useEffect, useState } from 'preact/hooks';
import type { AppServices } from '../../../../app/app-services.ts';
import { attempt } from '../../../../app/attempt.ts';
import { CaptureSession } from '../../../../app/capture/capture-session.ts';
import type { CameraStart, CameraView, CaptureDevices } from '../../../../app/capture/sensor-interfaces.ts';
import { isPracticeSurvey } from '../../../../app/capture/practice-place.ts';
import type { SightingAxis, Survey } from '../../../../core/survey/survey.ts';
import { chooseSightingWay, sightingWay } from '../../../device/sighting-way.ts';
import { startPractice } from '../practice.ts';

export interface Capture {
  /** Null while the device's part of the app is loaded. */
  devices: CaptureDevices | null;
  session: CaptureSession | null;
  camera: CameraView | null;
  /** Why there is no camera, where one was wished for. */
  noCamera: Extract<CameraStart, { ok: false }>['why'] | null;
  /** Starts the sensor, and the camera where the sighting axis is the camera; called inside a tap. */
  begin: (axis: SightingAxis) => void;
  /** Sights with something else from now on, on this device. */
  sightWith: (axis: SightingAxis) => void;
  /** Whether the recorded movement may be played into this survey: it is one to practise in. */
  mayPlay: boolean;
  /** A recorded movement in place of the sensor; elsewhere than in a practice survey, the way to one. */
  practise: () => void;
  again: () => void;
}

/** Whether the sensor was started by a tap since this page was opened: no tap is needed for it then. */
let granted = false;

/** A sitting with the sensor while a screen is open: started by a tap, ended with the screen. */
export function useCapture(
  services: AppServices,
  survey: Survey,
  recordings: 'sighting' | 'plane' = 'sighting',
): Capture {
  const surveyId = survey.id;
  const [devices, setDevices] = useState<CaptureDevices | null>(null);
  const [session, setSession] = useState<CaptureSession | null>(null);
  const [camera, setCamera] = useState<CameraView | null>(null);
  const [noCamera, setNoCamera] = useState<Capture['noCamera']>(null);

  useEffect(() => {
    let wanted = true;
    services.capture().then(
      (loaded) => wanted && setDevices(loaded),
      (cause: unknown) => (services.state.trouble.value = { code: 'part-missing', detail: String(cause) }),
    );
    return () => {
      wanted = false;
    };
  }, [services]);
  useEffect(() => () => session?.stop(), [session]);
  useEffect(() => () => camera?.close(), [camera]);
  useEffect(() => (session && devices ? devices.keepAwake() : undefined), [session, devices]);

  const begin = (from: CaptureDevices, axis: SightingAxis) => {
    const made = new CaptureSession(services, from.orientation, from.feedback, surveyId);
    made.axis.value = axis;
    setSession(made);
    // Both ask for permission, and both must do so while the tap still counts.
    void made.start().then(() => {
      if (made.sensor.value.state === 'on') granted = true;
    });
    if (axis === 'camera') void openCamera(from);
  };
  useEffect(() => {
    // asked, told to mind one's feet, and allowed at an earlier station: on with it
    if (devices && granted && recordings === 'sighting' && !isPracticeSurvey(survey))
      begin(devices, sightingWay.value);
  }, [devices]);

  const openCamera = async (from: CaptureDevices) => {
    const outcome = await from.openCamera();
    if (outcome.ok) setCamera(outcome.view);
    else setNoCamera(outcome.why);
  };
  const play = async (from: CaptureDevices) => {
    from.feedback.prime();
    const recording = await from.openRecording(recordings);
    const made = new CaptureSession(services, recording, from.feedback, surveyId);
    setSession(made);
    await made.start();
  };
  return {
    devices,
    session,
    camera,
    noCamera,
    mayPlay: isPracticeSurvey(survey),
    begin(axis) {
      if (!devices) return;
      chooseSightingWay(axis);
      begin(devices, axis);
    },
    sightWith(axis) {
      if (!session || !devices) return;
      chooseSightingWay(axis);
      session.axis.value = axis;
      if (axis === 'camera' && !camera) {
        setNoCamera(null);
        void openCamera(devices);
      }
    },
    practise() {
      if (!isPracticeSurvey(survey)) void startPractice(services);
      else if (devices) void attempt(services.state, () => play(devices));
    },
    again() {
      setSession(null);
      setNoCamera(null);
    },
  };
}
