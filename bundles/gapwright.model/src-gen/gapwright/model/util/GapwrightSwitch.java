/**
 */
package gapwright.model.util;

import gapwright.model.*;

import org.eclipse.emf.ecore.EObject;
import org.eclipse.emf.ecore.EPackage;

import org.eclipse.emf.ecore.util.Switch;

/**
 * <!-- begin-user-doc -->
 * The <b>Switch</b> for the model's inheritance hierarchy.
 * It supports the call {@link #doSwitch(EObject) doSwitch(object)}
 * to invoke the <code>caseXXX</code> method for each class of the model,
 * starting with the actual class of the object
 * and proceeding up the inheritance hierarchy
 * until a non-null result is returned,
 * which is the result of the switch.
 * <!-- end-user-doc -->
 * @see gapwright.model.GapwrightPackage
 * @generated
 */
public class GapwrightSwitch<T> extends Switch<T> {
	/**
	 * The cached model package
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	protected static GapwrightPackage modelPackage;

	/**
	 * Creates an instance of the switch.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	public GapwrightSwitch() {
		if (modelPackage == null) {
			modelPackage = GapwrightPackage.eINSTANCE;
		}
	}

	/**
	 * Checks whether this is a switch for the given package.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param ePackage the package in question.
	 * @return whether this is a switch for the given package.
	 * @generated
	 */
	@Override
	protected boolean isSwitchFor(EPackage ePackage) {
		return ePackage == modelPackage;
	}

	/**
	 * Calls <code>caseXXX</code> for each class of the model until one returns a non null result; it yields that result.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the first non-null result returned by a <code>caseXXX</code> call.
	 * @generated
	 */
	@Override
	protected T doSwitch(int classifierID, EObject theEObject) {
		switch (classifierID) {
			case GapwrightPackage.DESIGN: {
				Design design = (Design)theEObject;
				T result = caseDesign(design);
				if (result == null) result = defaultCase(theEObject);
				return result;
			}
			case GapwrightPackage.ELEMENT: {
				Element element = (Element)theEObject;
				T result = caseElement(element);
				if (result == null) result = defaultCase(theEObject);
				return result;
			}
			case GapwrightPackage.JOINT: {
				Joint joint = (Joint)theEObject;
				T result = caseJoint(joint);
				if (result == null) result = caseElement(joint);
				if (result == null) result = defaultCase(theEObject);
				return result;
			}
			case GapwrightPackage.LEG: {
				Leg leg = (Leg)theEObject;
				T result = caseLeg(leg);
				if (result == null) result = caseElement(leg);
				if (result == null) result = defaultCase(theEObject);
				return result;
			}
			case GapwrightPackage.GAP: {
				Gap gap = (Gap)theEObject;
				T result = caseGap(gap);
				if (result == null) result = caseElement(gap);
				if (result == null) result = defaultCase(theEObject);
				return result;
			}
			case GapwrightPackage.MAGNET: {
				Magnet magnet = (Magnet)theEObject;
				T result = caseMagnet(magnet);
				if (result == null) result = caseElement(magnet);
				if (result == null) result = defaultCase(theEObject);
				return result;
			}
			case GapwrightPackage.AIR_PATH: {
				AirPath airPath = (AirPath)theEObject;
				T result = caseAirPath(airPath);
				if (result == null) result = caseElement(airPath);
				if (result == null) result = defaultCase(theEObject);
				return result;
			}
			case GapwrightPackage.WINDING: {
				Winding winding = (Winding)theEObject;
				T result = caseWinding(winding);
				if (result == null) result = caseElement(winding);
				if (result == null) result = defaultCase(theEObject);
				return result;
			}
			case GapwrightPackage.COIL: {
				Coil coil = (Coil)theEObject;
				T result = caseCoil(coil);
				if (result == null) result = caseElement(coil);
				if (result == null) result = defaultCase(theEObject);
				return result;
			}
			case GapwrightPackage.MATERIAL: {
				Material material = (Material)theEObject;
				T result = caseMaterial(material);
				if (result == null) result = caseElement(material);
				if (result == null) result = defaultCase(theEObject);
				return result;
			}
			case GapwrightPackage.CURVE: {
				Curve curve = (Curve)theEObject;
				T result = caseCurve(curve);
				if (result == null) result = defaultCase(theEObject);
				return result;
			}
			case GapwrightPackage.LINEAR_CURVE: {
				LinearCurve linearCurve = (LinearCurve)theEObject;
				T result = caseLinearCurve(linearCurve);
				if (result == null) result = caseCurve(linearCurve);
				if (result == null) result = defaultCase(theEObject);
				return result;
			}
			case GapwrightPackage.KNEE_CURVE: {
				KneeCurve kneeCurve = (KneeCurve)theEObject;
				T result = caseKneeCurve(kneeCurve);
				if (result == null) result = caseCurve(kneeCurve);
				if (result == null) result = defaultCase(theEObject);
				return result;
			}
			case GapwrightPackage.ARCTAN_CURVE: {
				ArctanCurve arctanCurve = (ArctanCurve)theEObject;
				T result = caseArctanCurve(arctanCurve);
				if (result == null) result = caseCurve(arctanCurve);
				if (result == null) result = defaultCase(theEObject);
				return result;
			}
			case GapwrightPackage.TABLE_CURVE: {
				TableCurve tableCurve = (TableCurve)theEObject;
				T result = caseTableCurve(tableCurve);
				if (result == null) result = caseCurve(tableCurve);
				if (result == null) result = defaultCase(theEObject);
				return result;
			}
			case GapwrightPackage.CURVE_POINT: {
				CurvePoint curvePoint = (CurvePoint)theEObject;
				T result = caseCurvePoint(curvePoint);
				if (result == null) result = defaultCase(theEObject);
				return result;
			}
			case GapwrightPackage.ROLL_OFF_CURVE: {
				RollOffCurve rollOffCurve = (RollOffCurve)theEObject;
				T result = caseRollOffCurve(rollOffCurve);
				if (result == null) result = caseCurve(rollOffCurve);
				if (result == null) result = defaultCase(theEObject);
				return result;
			}
			case GapwrightPackage.SATURATION: {
				Saturation saturation = (Saturation)theEObject;
				T result = caseSaturation(saturation);
				if (result == null) result = defaultCase(theEObject);
				return result;
			}
			case GapwrightPackage.CURVE_AT_TEMPERATURE: {
				CurveAtTemperature curveAtTemperature = (CurveAtTemperature)theEObject;
				T result = caseCurveAtTemperature(curveAtTemperature);
				if (result == null) result = defaultCase(theEObject);
				return result;
			}
			case GapwrightPackage.INITIAL_PERMEABILITY: {
				InitialPermeability initialPermeability = (InitialPermeability)theEObject;
				T result = caseInitialPermeability(initialPermeability);
				if (result == null) result = defaultCase(theEObject);
				return result;
			}
			case GapwrightPackage.STEINMETZ_LOSS: {
				SteinmetzLoss steinmetzLoss = (SteinmetzLoss)theEObject;
				T result = caseSteinmetzLoss(steinmetzLoss);
				if (result == null) result = defaultCase(theEObject);
				return result;
			}
			case GapwrightPackage.OPERATING_POINT: {
				OperatingPoint operatingPoint = (OperatingPoint)theEObject;
				T result = caseOperatingPoint(operatingPoint);
				if (result == null) result = caseElement(operatingPoint);
				if (result == null) result = defaultCase(theEObject);
				return result;
			}
			case GapwrightPackage.DRIVE: {
				Drive drive = (Drive)theEObject;
				T result = caseDrive(drive);
				if (result == null) result = caseElement(drive);
				if (result == null) result = defaultCase(theEObject);
				return result;
			}
			case GapwrightPackage.CURRENT_DRIVE: {
				CurrentDrive currentDrive = (CurrentDrive)theEObject;
				T result = caseCurrentDrive(currentDrive);
				if (result == null) result = caseDrive(currentDrive);
				if (result == null) result = caseElement(currentDrive);
				if (result == null) result = defaultCase(theEObject);
				return result;
			}
			case GapwrightPackage.VOLTAGE_DRIVE: {
				VoltageDrive voltageDrive = (VoltageDrive)theEObject;
				T result = caseVoltageDrive(voltageDrive);
				if (result == null) result = caseDrive(voltageDrive);
				if (result == null) result = caseElement(voltageDrive);
				if (result == null) result = defaultCase(theEObject);
				return result;
			}
			case GapwrightPackage.LIMITS: {
				Limits limits = (Limits)theEObject;
				T result = caseLimits(limits);
				if (result == null) result = defaultCase(theEObject);
				return result;
			}
			case GapwrightPackage.WINDING_LEAKAGE: {
				WindingLeakage windingLeakage = (WindingLeakage)theEObject;
				T result = caseWindingLeakage(windingLeakage);
				if (result == null) result = caseElement(windingLeakage);
				if (result == null) result = defaultCase(theEObject);
				return result;
			}
			case GapwrightPackage.WINDING_CONNECTION: {
				WindingConnection windingConnection = (WindingConnection)theEObject;
				T result = caseWindingConnection(windingConnection);
				if (result == null) result = caseElement(windingConnection);
				if (result == null) result = defaultCase(theEObject);
				return result;
			}
			case GapwrightPackage.CONNECTED_WINDING: {
				ConnectedWinding connectedWinding = (ConnectedWinding)theEObject;
				T result = caseConnectedWinding(connectedWinding);
				if (result == null) result = defaultCase(theEObject);
				return result;
			}
			case GapwrightPackage.TOLERANCE: {
				Tolerance tolerance = (Tolerance)theEObject;
				T result = caseTolerance(tolerance);
				if (result == null) result = caseElement(tolerance);
				if (result == null) result = defaultCase(theEObject);
				return result;
			}
			default: return defaultCase(theEObject);
		}
	}

	/**
	 * Returns the result of interpreting the object as an instance of '<em>Design</em>'.
	 * <!-- begin-user-doc -->
	 * This implementation returns null;
	 * returning a non-null result will terminate the switch.
	 * <!-- end-user-doc -->
	 * @param object the target of the switch.
	 * @return the result of interpreting the object as an instance of '<em>Design</em>'.
	 * @see #doSwitch(org.eclipse.emf.ecore.EObject) doSwitch(EObject)
	 * @generated
	 */
	public T caseDesign(Design object) {
		return null;
	}

	/**
	 * Returns the result of interpreting the object as an instance of '<em>Element</em>'.
	 * <!-- begin-user-doc -->
	 * This implementation returns null;
	 * returning a non-null result will terminate the switch.
	 * <!-- end-user-doc -->
	 * @param object the target of the switch.
	 * @return the result of interpreting the object as an instance of '<em>Element</em>'.
	 * @see #doSwitch(org.eclipse.emf.ecore.EObject) doSwitch(EObject)
	 * @generated
	 */
	public T caseElement(Element object) {
		return null;
	}

	/**
	 * Returns the result of interpreting the object as an instance of '<em>Joint</em>'.
	 * <!-- begin-user-doc -->
	 * This implementation returns null;
	 * returning a non-null result will terminate the switch.
	 * <!-- end-user-doc -->
	 * @param object the target of the switch.
	 * @return the result of interpreting the object as an instance of '<em>Joint</em>'.
	 * @see #doSwitch(org.eclipse.emf.ecore.EObject) doSwitch(EObject)
	 * @generated
	 */
	public T caseJoint(Joint object) {
		return null;
	}

	/**
	 * Returns the result of interpreting the object as an instance of '<em>Leg</em>'.
	 * <!-- begin-user-doc -->
	 * This implementation returns null;
	 * returning a non-null result will terminate the switch.
	 * <!-- end-user-doc -->
	 * @param object the target of the switch.
	 * @return the result of interpreting the object as an instance of '<em>Leg</em>'.
	 * @see #doSwitch(org.eclipse.emf.ecore.EObject) doSwitch(EObject)
	 * @generated
	 */
	public T caseLeg(Leg object) {
		return null;
	}

	/**
	 * Returns the result of interpreting the object as an instance of '<em>Gap</em>'.
	 * <!-- begin-user-doc -->
	 * This implementation returns null;
	 * returning a non-null result will terminate the switch.
	 * <!-- end-user-doc -->
	 * @param object the target of the switch.
	 * @return the result of interpreting the object as an instance of '<em>Gap</em>'.
	 * @see #doSwitch(org.eclipse.emf.ecore.EObject) doSwitch(EObject)
	 * @generated
	 */
	public T caseGap(Gap object) {
		return null;
	}

	/**
	 * Returns the result of interpreting the object as an instance of '<em>Magnet</em>'.
	 * <!-- begin-user-doc -->
	 * This implementation returns null;
	 * returning a non-null result will terminate the switch.
	 * <!-- end-user-doc -->
	 * @param object the target of the switch.
	 * @return the result of interpreting the object as an instance of '<em>Magnet</em>'.
	 * @see #doSwitch(org.eclipse.emf.ecore.EObject) doSwitch(EObject)
	 * @generated
	 */
	public T caseMagnet(Magnet object) {
		return null;
	}

	/**
	 * Returns the result of interpreting the object as an instance of '<em>Air Path</em>'.
	 * <!-- begin-user-doc -->
	 * This implementation returns null;
	 * returning a non-null result will terminate the switch.
	 * <!-- end-user-doc -->
	 * @param object the target of the switch.
	 * @return the result of interpreting the object as an instance of '<em>Air Path</em>'.
	 * @see #doSwitch(org.eclipse.emf.ecore.EObject) doSwitch(EObject)
	 * @generated
	 */
	public T caseAirPath(AirPath object) {
		return null;
	}

	/**
	 * Returns the result of interpreting the object as an instance of '<em>Winding</em>'.
	 * <!-- begin-user-doc -->
	 * This implementation returns null;
	 * returning a non-null result will terminate the switch.
	 * <!-- end-user-doc -->
	 * @param object the target of the switch.
	 * @return the result of interpreting the object as an instance of '<em>Winding</em>'.
	 * @see #doSwitch(org.eclipse.emf.ecore.EObject) doSwitch(EObject)
	 * @generated
	 */
	public T caseWinding(Winding object) {
		return null;
	}

	/**
	 * Returns the result of interpreting the object as an instance of '<em>Coil</em>'.
	 * <!-- begin-user-doc -->
	 * This implementation returns null;
	 * returning a non-null result will terminate the switch.
	 * <!-- end-user-doc -->
	 * @param object the target of the switch.
	 * @return the result of interpreting the object as an instance of '<em>Coil</em>'.
	 * @see #doSwitch(org.eclipse.emf.ecore.EObject) doSwitch(EObject)
	 * @generated
	 */
	public T caseCoil(Coil object) {
		return null;
	}

	/**
	 * Returns the result of interpreting the object as an instance of '<em>Material</em>'.
	 * <!-- begin-user-doc -->
	 * This implementation returns null;
	 * returning a non-null result will terminate the switch.
	 * <!-- end-user-doc -->
	 * @param object the target of the switch.
	 * @return the result of interpreting the object as an instance of '<em>Material</em>'.
	 * @see #doSwitch(org.eclipse.emf.ecore.EObject) doSwitch(EObject)
	 * @generated
	 */
	public T caseMaterial(Material object) {
		return null;
	}

	/**
	 * Returns the result of interpreting the object as an instance of '<em>Curve</em>'.
	 * <!-- begin-user-doc -->
	 * This implementation returns null;
	 * returning a non-null result will terminate the switch.
	 * <!-- end-user-doc -->
	 * @param object the target of the switch.
	 * @return the result of interpreting the object as an instance of '<em>Curve</em>'.
	 * @see #doSwitch(org.eclipse.emf.ecore.EObject) doSwitch(EObject)
	 * @generated
	 */
	public T caseCurve(Curve object) {
		return null;
	}

	/**
	 * Returns the result of interpreting the object as an instance of '<em>Linear Curve</em>'.
	 * <!-- begin-user-doc -->
	 * This implementation returns null;
	 * returning a non-null result will terminate the switch.
	 * <!-- end-user-doc -->
	 * @param object the target of the switch.
	 * @return the result of interpreting the object as an instance of '<em>Linear Curve</em>'.
	 * @see #doSwitch(org.eclipse.emf.ecore.EObject) doSwitch(EObject)
	 * @generated
	 */
	public T caseLinearCurve(LinearCurve object) {
		return null;
	}

	/**
	 * Returns the result of interpreting the object as an instance of '<em>Knee Curve</em>'.
	 * <!-- begin-user-doc -->
	 * This implementation returns null;
	 * returning a non-null result will terminate the switch.
	 * <!-- end-user-doc -->
	 * @param object the target of the switch.
	 * @return the result of interpreting the object as an instance of '<em>Knee Curve</em>'.
	 * @see #doSwitch(org.eclipse.emf.ecore.EObject) doSwitch(EObject)
	 * @generated
	 */
	public T caseKneeCurve(KneeCurve object) {
		return null;
	}

	/**
	 * Returns the result of interpreting the object as an instance of '<em>Arctan Curve</em>'.
	 * <!-- begin-user-doc -->
	 * This implementation returns null;
	 * returning a non-null result will terminate the switch.
	 * <!-- end-user-doc -->
	 * @param object the target of the switch.
	 * @return the result of interpreting the object as an instance of '<em>Arctan Curve</em>'.
	 * @see #doSwitch(org.eclipse.emf.ecore.EObject) doSwitch(EObject)
	 * @generated
	 */
	public T caseArctanCurve(ArctanCurve object) {
		return null;
	}

	/**
	 * Returns the result of interpreting the object as an instance of '<em>Table Curve</em>'.
	 * <!-- begin-user-doc -->
	 * This implementation returns null;
	 * returning a non-null result will terminate the switch.
	 * <!-- end-user-doc -->
	 * @param object the target of the switch.
	 * @return the result of interpreting the object as an instance of '<em>Table Curve</em>'.
	 * @see #doSwitch(org.eclipse.emf.ecore.EObject) doSwitch(EObject)
	 * @generated
	 */
	public T caseTableCurve(TableCurve object) {
		return null;
	}

	/**
	 * Returns the result of interpreting the object as an instance of '<em>Curve Point</em>'.
	 * <!-- begin-user-doc -->
	 * This implementation returns null;
	 * returning a non-null result will terminate the switch.
	 * <!-- end-user-doc -->
	 * @param object the target of the switch.
	 * @return the result of interpreting the object as an instance of '<em>Curve Point</em>'.
	 * @see #doSwitch(org.eclipse.emf.ecore.EObject) doSwitch(EObject)
	 * @generated
	 */
	public T caseCurvePoint(CurvePoint object) {
		return null;
	}

	/**
	 * Returns the result of interpreting the object as an instance of '<em>Roll Off Curve</em>'.
	 * <!-- begin-user-doc -->
	 * This implementation returns null;
	 * returning a non-null result will terminate the switch.
	 * <!-- end-user-doc -->
	 * @param object the target of the switch.
	 * @return the result of interpreting the object as an instance of '<em>Roll Off Curve</em>'.
	 * @see #doSwitch(org.eclipse.emf.ecore.EObject) doSwitch(EObject)
	 * @generated
	 */
	public T caseRollOffCurve(RollOffCurve object) {
		return null;
	}

	/**
	 * Returns the result of interpreting the object as an instance of '<em>Saturation</em>'.
	 * <!-- begin-user-doc -->
	 * This implementation returns null;
	 * returning a non-null result will terminate the switch.
	 * <!-- end-user-doc -->
	 * @param object the target of the switch.
	 * @return the result of interpreting the object as an instance of '<em>Saturation</em>'.
	 * @see #doSwitch(org.eclipse.emf.ecore.EObject) doSwitch(EObject)
	 * @generated
	 */
	public T caseSaturation(Saturation object) {
		return null;
	}

	/**
	 * Returns the result of interpreting the object as an instance of '<em>Curve At Temperature</em>'.
	 * <!-- begin-user-doc -->
	 * This implementation returns null;
	 * returning a non-null result will terminate the switch.
	 * <!-- end-user-doc -->
	 * @param object the target of the switch.
	 * @return the result of interpreting the object as an instance of '<em>Curve At Temperature</em>'.
	 * @see #doSwitch(org.eclipse.emf.ecore.EObject) doSwitch(EObject)
	 * @generated
	 */
	public T caseCurveAtTemperature(CurveAtTemperature object) {
		return null;
	}

	/**
	 * Returns the result of interpreting the object as an instance of '<em>Initial Permeability</em>'.
	 * <!-- begin-user-doc -->
	 * This implementation returns null;
	 * returning a non-null result will terminate the switch.
	 * <!-- end-user-doc -->
	 * @param object the target of the switch.
	 * @return the result of interpreting the object as an instance of '<em>Initial Permeability</em>'.
	 * @see #doSwitch(org.eclipse.emf.ecore.EObject) doSwitch(EObject)
	 * @generated
	 */
	public T caseInitialPermeability(InitialPermeability object) {
		return null;
	}

	/**
	 * Returns the result of interpreting the object as an instance of '<em>Steinmetz Loss</em>'.
	 * <!-- begin-user-doc -->
	 * This implementation returns null;
	 * returning a non-null result will terminate the switch.
	 * <!-- end-user-doc -->
	 * @param object the target of the switch.
	 * @return the result of interpreting the object as an instance of '<em>Steinmetz Loss</em>'.
	 * @see #doSwitch(org.eclipse.emf.ecore.EObject) doSwitch(EObject)
	 * @generated
	 */
	public T caseSteinmetzLoss(SteinmetzLoss object) {
		return null;
	}

	/**
	 * Returns the result of interpreting the object as an instance of '<em>Operating Point</em>'.
	 * <!-- begin-user-doc -->
	 * This implementation returns null;
	 * returning a non-null result will terminate the switch.
	 * <!-- end-user-doc -->
	 * @param object the target of the switch.
	 * @return the result of interpreting the object as an instance of '<em>Operating Point</em>'.
	 * @see #doSwitch(org.eclipse.emf.ecore.EObject) doSwitch(EObject)
	 * @generated
	 */
	public T caseOperatingPoint(OperatingPoint object) {
		return null;
	}

	/**
	 * Returns the result of interpreting the object as an instance of '<em>Drive</em>'.
	 * <!-- begin-user-doc -->
	 * This implementation returns null;
	 * returning a non-null result will terminate the switch.
	 * <!-- end-user-doc -->
	 * @param object the target of the switch.
	 * @return the result of interpreting the object as an instance of '<em>Drive</em>'.
	 * @see #doSwitch(org.eclipse.emf.ecore.EObject) doSwitch(EObject)
	 * @generated
	 */
	public T caseDrive(Drive object) {
		return null;
	}

	/**
	 * Returns the result of interpreting the object as an instance of '<em>Current Drive</em>'.
	 * <!-- begin-user-doc -->
	 * This implementation returns null;
	 * returning a non-null result will terminate the switch.
	 * <!-- end-user-doc -->
	 * @param object the target of the switch.
	 * @return the result of interpreting the object as an instance of '<em>Current Drive</em>'.
	 * @see #doSwitch(org.eclipse.emf.ecore.EObject) doSwitch(EObject)
	 * @generated
	 */
	public T caseCurrentDrive(CurrentDrive object) {
		return null;
	}

	/**
	 * Returns the result of interpreting the object as an instance of '<em>Voltage Drive</em>'.
	 * <!-- begin-user-doc -->
	 * This implementation returns null;
	 * returning a non-null result will terminate the switch.
	 * <!-- end-user-doc -->
	 * @param object the target of the switch.
	 * @return the result of interpreting the object as an instance of '<em>Voltage Drive</em>'.
	 * @see #doSwitch(org.eclipse.emf.ecore.EObject) doSwitch(EObject)
	 * @generated
	 */
	public T caseVoltageDrive(VoltageDrive object) {
		return null;
	}

	/**
	 * Returns the result of interpreting the object as an instance of '<em>Limits</em>'.
	 * <!-- begin-user-doc -->
	 * This implementation returns null;
	 * returning a non-null result will terminate the switch.
	 * <!-- end-user-doc -->
	 * @param object the target of the switch.
	 * @return the result of interpreting the object as an instance of '<em>Limits</em>'.
	 * @see #doSwitch(org.eclipse.emf.ecore.EObject) doSwitch(EObject)
	 * @generated
	 */
	public T caseLimits(Limits object) {
		return null;
	}

	/**
	 * Returns the result of interpreting the object as an instance of '<em>Winding Leakage</em>'.
	 * <!-- begin-user-doc -->
	 * This implementation returns null;
	 * returning a non-null result will terminate the switch.
	 * <!-- end-user-doc -->
	 * @param object the target of the switch.
	 * @return the result of interpreting the object as an instance of '<em>Winding Leakage</em>'.
	 * @see #doSwitch(org.eclipse.emf.ecore.EObject) doSwitch(EObject)
	 * @generated
	 */
	public T caseWindingLeakage(WindingLeakage object) {
		return null;
	}

	/**
	 * Returns the result of interpreting the object as an instance of '<em>Winding Connection</em>'.
	 * <!-- begin-user-doc -->
	 * This implementation returns null;
	 * returning a non-null result will terminate the switch.
	 * <!-- end-user-doc -->
	 * @param object the target of the switch.
	 * @return the result of interpreting the object as an instance of '<em>Winding Connection</em>'.
	 * @see #doSwitch(org.eclipse.emf.ecore.EObject) doSwitch(EObject)
	 * @generated
	 */
	public T caseWindingConnection(WindingConnection object) {
		return null;
	}

	/**
	 * Returns the result of interpreting the object as an instance of '<em>Connected Winding</em>'.
	 * <!-- begin-user-doc -->
	 * This implementation returns null;
	 * returning a non-null result will terminate the switch.
	 * <!-- end-user-doc -->
	 * @param object the target of the switch.
	 * @return the result of interpreting the object as an instance of '<em>Connected Winding</em>'.
	 * @see #doSwitch(org.eclipse.emf.ecore.EObject) doSwitch(EObject)
	 * @generated
	 */
	public T caseConnectedWinding(ConnectedWinding object) {
		return null;
	}

	/**
	 * Returns the result of interpreting the object as an instance of '<em>Tolerance</em>'.
	 * <!-- begin-user-doc -->
	 * This implementation returns null;
	 * returning a non-null result will terminate the switch.
	 * <!-- end-user-doc -->
	 * @param object the target of the switch.
	 * @return the result of interpreting the object as an instance of '<em>Tolerance</em>'.
	 * @see #doSwitch(org.eclipse.emf.ecore.EObject) doSwitch(EObject)
	 * @generated
	 */
	public T caseTolerance(Tolerance object) {
		return null;
	}

	/**
	 * Returns the result of interpreting the object as an instance of '<em>EObject</em>'.
	 * <!-- begin-user-doc -->
	 * This implementation returns null;
	 * returning a non-null result will terminate the switch, but this is the last case anyway.
	 * <!-- end-user-doc -->
	 * @param object the target of the switch.
	 * @return the result of interpreting the object as an instance of '<em>EObject</em>'.
	 * @see #doSwitch(org.eclipse.emf.ecore.EObject)
	 * @generated
	 */
	@Override
	public T defaultCase(EObject object) {
		return null;
	}

} //GapwrightSwitch
