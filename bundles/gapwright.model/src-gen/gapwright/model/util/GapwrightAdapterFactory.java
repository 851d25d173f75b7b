/**
 */
package gapwright.model.util;

import gapwright.model.*;

import org.eclipse.emf.common.notify.Adapter;
import org.eclipse.emf.common.notify.Notifier;

import org.eclipse.emf.common.notify.impl.AdapterFactoryImpl;

import org.eclipse.emf.ecore.EObject;

/**
 * <!-- begin-user-doc -->
 * The <b>Adapter Factory</b> for the model.
 * It provides an adapter <code>createXXX</code> method for each class of the model.
 * <!-- end-user-doc -->
 * @see gapwright.model.GapwrightPackage
 * @generated
 */
public class GapwrightAdapterFactory extends AdapterFactoryImpl {
	/**
	 * The cached model package.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	protected static GapwrightPackage modelPackage;

	/**
	 * Creates an instance of the adapter factory.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	public GapwrightAdapterFactory() {
		if (modelPackage == null) {
			modelPackage = GapwrightPackage.eINSTANCE;
		}
	}

	/**
	 * Returns whether this factory is applicable for the type of the object.
	 * <!-- begin-user-doc -->
	 * This implementation returns <code>true</code> if the object is either the model's package or is an instance object of the model.
	 * <!-- end-user-doc -->
	 * @return whether this factory is applicable for the type of the object.
	 * @generated
	 */
	@Override
	public boolean isFactoryForType(Object object) {
		if (object == modelPackage) {
			return true;
		}
		if (object instanceof EObject) {
			return ((EObject)object).eClass().getEPackage() == modelPackage;
		}
		return false;
	}

	/**
	 * The switch that delegates to the <code>createXXX</code> methods.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	protected GapwrightSwitch<Adapter> modelSwitch =
		new GapwrightSwitch<Adapter>() {
			@Override
			public Adapter caseDesign(Design object) {
				return createDesignAdapter();
			}
			@Override
			public Adapter caseElement(Element object) {
				return createElementAdapter();
			}
			@Override
			public Adapter caseJoint(Joint object) {
				return createJointAdapter();
			}
			@Override
			public Adapter caseLeg(Leg object) {
				return createLegAdapter();
			}
			@Override
			public Adapter caseGap(Gap object) {
				return createGapAdapter();
			}
			@Override
			public Adapter caseMagnet(Magnet object) {
				return createMagnetAdapter();
			}
			@Override
			public Adapter caseAirPath(AirPath object) {
				return createAirPathAdapter();
			}
			@Override
			public Adapter caseWinding(Winding object) {
				return createWindingAdapter();
			}
			@Override
			public Adapter caseCoil(Coil object) {
				return createCoilAdapter();
			}
			@Override
			public Adapter caseMaterial(Material object) {
				return createMaterialAdapter();
			}
			@Override
			public Adapter caseCurve(Curve object) {
				return createCurveAdapter();
			}
			@Override
			public Adapter caseLinearCurve(LinearCurve object) {
				return createLinearCurveAdapter();
			}
			@Override
			public Adapter caseKneeCurve(KneeCurve object) {
				return createKneeCurveAdapter();
			}
			@Override
			public Adapter caseArctanCurve(ArctanCurve object) {
				return createArctanCurveAdapter();
			}
			@Override
			public Adapter caseTableCurve(TableCurve object) {
				return createTableCurveAdapter();
			}
			@Override
			public Adapter caseCurvePoint(CurvePoint object) {
				return createCurvePointAdapter();
			}
			@Override
			public Adapter caseRollOffCurve(RollOffCurve object) {
				return createRollOffCurveAdapter();
			}
			@Override
			public Adapter caseSaturation(Saturation object) {
				return createSaturationAdapter();
			}
			@Override
			public Adapter caseCurveAtTemperature(CurveAtTemperature object) {
				return createCurveAtTemperatureAdapter();
			}
			@Override
			public Adapter caseInitialPermeability(InitialPermeability object) {
				return createInitialPermeabilityAdapter();
			}
			@Override
			public Adapter caseSteinmetzLoss(SteinmetzLoss object) {
				return createSteinmetzLossAdapter();
			}
			@Override
			public Adapter caseOperatingPoint(OperatingPoint object) {
				return createOperatingPointAdapter();
			}
			@Override
			public Adapter caseDrive(Drive object) {
				return createDriveAdapter();
			}
			@Override
			public Adapter caseCurrentDrive(CurrentDrive object) {
				return createCurrentDriveAdapter();
			}
			@Override
			public Adapter caseVoltageDrive(VoltageDrive object) {
				return createVoltageDriveAdapter();
			}
			@Override
			public Adapter caseLimits(Limits object) {
				return createLimitsAdapter();
			}
			@Override
			public Adapter caseWindingLeakage(WindingLeakage object) {
				return createWindingLeakageAdapter();
			}
			@Override
			public Adapter caseWindingConnection(WindingConnection object) {
				return createWindingConnectionAdapter();
			}
			@Override
			public Adapter caseConnectedWinding(ConnectedWinding object) {
				return createConnectedWindingAdapter();
			}
			@Override
			public Adapter caseTolerance(Tolerance object) {
				return createToleranceAdapter();
			}
			@Override
			public Adapter defaultCase(EObject object) {
				return createEObjectAdapter();
			}
		};

	/**
	 * Creates an adapter for the <code>target</code>.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param target the object to adapt.
	 * @return the adapter for the <code>target</code>.
	 * @generated
	 */
	@Override
	public Adapter createAdapter(Notifier target) {
		return modelSwitch.doSwitch((EObject)target);
	}


	/**
	 * Creates a new adapter for an object of class '{@link gapwright.model.Design <em>Design</em>}'.
	 * <!-- begin-user-doc -->
	 * This default implementation returns null so that we can easily ignore cases;
	 * it's useful to ignore a case when inheritance will catch all the cases anyway.
	 * <!-- end-user-doc -->
	 * @return the new adapter.
	 * @see gapwright.model.Design
	 * @generated
	 */
	public Adapter createDesignAdapter() {
		return null;
	}

	/**
	 * Creates a new adapter for an object of class '{@link gapwright.model.Element <em>Element</em>}'.
	 * <!-- begin-user-doc -->
	 * This default implementation returns null so that we can easily ignore cases;
	 * it's useful to ignore a case when inheritance will catch all the cases anyway.
	 * <!-- end-user-doc -->
	 * @return the new adapter.
	 * @see gapwright.model.Element
	 * @generated
	 */
	public Adapter createElementAdapter() {
		return null;
	}

	/**
	 * Creates a new adapter for an object of class '{@link gapwright.model.Joint <em>Joint</em>}'.
	 * <!-- begin-user-doc -->
	 * This default implementation returns null so that we can easily ignore cases;
	 * it's useful to ignore a case when inheritance will catch all the cases anyway.
	 * <!-- end-user-doc -->
	 * @return the new adapter.
	 * @see gapwright.model.Joint
	 * @generated
	 */
	public Adapter createJointAdapter() {
		return null;
	}

	/**
	 * Creates a new adapter for an object of class '{@link gapwright.model.Leg <em>Leg</em>}'.
	 * <!-- begin-user-doc -->
	 * This default implementation returns null so that we can easily ignore cases;
	 * it's useful to ignore a case when inheritance will catch all the cases anyway.
	 * <!-- end-user-doc -->
	 * @return the new adapter.
	 * @see gapwright.model.Leg
	 * @generated
	 */
	public Adapter createLegAdapter() {
		return null;
	}

	/**
	 * Creates a new adapter for an object of class '{@link gapwright.model.Gap <em>Gap</em>}'.
	 * <!-- begin-user-doc -->
	 * This default implementation returns null so that we can easily ignore cases;
	 * it's useful to ignore a case when inheritance will catch all the cases anyway.
	 * <!-- end-user-doc -->
	 * @return the new adapter.
	 * @see gapwright.model.Gap
	 * @generated
	 */
	public Adapter createGapAdapter() {
		return null;
	}

	/**
	 * Creates a new adapter for an object of class '{@link gapwright.model.Magnet <em>Magnet</em>}'.
	 * <!-- begin-user-doc -->
	 * This default implementation returns null so that we can easily ignore cases;
	 * it's useful to ignore a case when inheritance will catch all the cases anyway.
	 * <!-- end-user-doc -->
	 * @return the new adapter.
	 * @see gapwright.model.Magnet
	 * @generated
	 */
	public Adapter createMagnetAdapter() {
		return null;
	}

	/**
	 * Creates a new adapter for an object of class '{@link gapwright.model.AirPath <em>Air Path</em>}'.
	 * <!-- begin-user-doc -->
	 * This default implementation returns null so that we can easily ignore cases;
	 * it's useful to ignore a case when inheritance will catch all the cases anyway.
	 * <!-- end-user-doc -->
	 * @return the new adapter.
	 * @see gapwright.model.AirPath
	 * @generated
	 */
	public Adapter createAirPathAdapter() {
		return null;
	}

	/**
	 * Creates a new adapter for an object of class '{@link gapwright.model.Winding <em>Winding</em>}'.
	 * <!-- begin-user-doc -->
	 * This default implementation returns null so that we can easily ignore cases;
	 * it's useful to ignore a case when inheritance will catch all the cases anyway.
	 * <!-- end-user-doc -->
	 * @return the new adapter.
	 * @see gapwright.model.Winding
	 * @generated
	 */
	public Adapter createWindingAdapter() {
		return null;
	}

	/**
	 * Creates a new adapter for an object of class '{@link gapwright.model.Coil <em>Coil</em>}'.
	 * <!-- begin-user-doc -->
	 * This default implementation returns null so that we can easily ignore cases;
	 * it's useful to ignore a case when inheritance will catch all the cases anyway.
	 * <!-- end-user-doc -->
	 * @return the new adapter.
	 * @see gapwright.model.Coil
	 * @generated
	 */
	public Adapter createCoilAdapter() {
		return null;
	}

	/**
	 * Creates a new adapter for an object of class '{@link gapwright.model.Material <em>Material</em>}'.
	 * <!-- begin-user-doc -->
	 * This default implementation returns null so that we can easily ignore cases;
	 * it's useful to ignore a case when inheritance will catch all the cases anyway.
	 * <!-- end-user-doc -->
	 * @return the new adapter.
	 * @see gapwright.model.Material
	 * @generated
	 */
	public Adapter createMaterialAdapter() {
		return null;
	}

	/**
	 * Creates a new adapter for an object of class '{@link gapwright.model.Curve <em>Curve</em>}'.
	 * <!-- begin-user-doc -->
	 * This default implementation returns null so that we can easily ignore cases;
	 * it's useful to ignore a case when inheritance will catch all the cases anyway.
	 * <!-- end-user-doc -->
	 * @return the new adapter.
	 * @see gapwright.model.Curve
	 * @generated
	 */
	public Adapter createCurveAdapter() {
		return null;
	}

	/**
	 * Creates a new adapter for an object of class '{@link gapwright.model.LinearCurve <em>Linear Curve</em>}'.
	 * <!-- begin-user-doc -->
	 * This default implementation returns null so that we can easily ignore cases;
	 * it's useful to ignore a case when inheritance will catch all the cases anyway.
	 * <!-- end-user-doc -->
	 * @return the new adapter.
	 * @see gapwright.model.LinearCurve
	 * @generated
	 */
	public Adapter createLinearCurveAdapter() {
		return null;
	}

	/**
	 * Creates a new adapter for an object of class '{@link gapwright.model.KneeCurve <em>Knee Curve</em>}'.
	 * <!-- begin-user-doc -->
	 * This default implementation returns null so that we can easily ignore cases;
	 * it's useful to ignore a case when inheritance will catch all the cases anyway.
	 * <!-- end-user-doc -->
	 * @return the new adapter.
	 * @see gapwright.model.KneeCurve
	 * @generated
	 */
	public Adapter createKneeCurveAdapter() {
		return null;
	}

	/**
	 * Creates a new adapter for an object of class '{@link gapwright.model.ArctanCurve <em>Arctan Curve</em>}'.
	 * <!-- begin-user-doc -->
	 * This default implementation returns null so that we can easily ignore cases;
	 * it's useful to ignore a case when inheritance will catch all the cases anyway.
	 * <!-- end-user-doc -->
	 * @return the new adapter.
	 * @see gapwright.model.ArctanCurve
	 * @generated
	 */
	public Adapter createArctanCurveAdapter() {
		return null;
	}

	/**
	 * Creates a new adapter for an object of class '{@link gapwright.model.TableCurve <em>Table Curve</em>}'.
	 * <!-- begin-user-doc -->
	 * This default implementation returns null so that we can easily ignore cases;
	 * it's useful to ignore a case when inheritance will catch all the cases anyway.
	 * <!-- end-user-doc -->
	 * @return the new adapter.
	 * @see gapwright.model.TableCurve
	 * @generated
	 */
	public Adapter createTableCurveAdapter() {
		return null;
	}

	/**
	 * Creates a new adapter for an object of class '{@link gapwright.model.CurvePoint <em>Curve Point</em>}'.
	 * <!-- begin-user-doc -->
	 * This default implementation returns null so that we can easily ignore cases;
	 * it's useful to ignore a case when inheritance will catch all the cases anyway.
	 * <!-- end-user-doc -->
	 * @return the new adapter.
	 * @see gapwright.model.CurvePoint
	 * @generated
	 */
	public Adapter createCurvePointAdapter() {
		return null;
	}

	/**
	 * Creates a new adapter for an object of class '{@link gapwright.model.RollOffCurve <em>Roll Off Curve</em>}'.
	 * <!-- begin-user-doc -->
	 * This default implementation returns null so that we can easily ignore cases;
	 * it's useful to ignore a case when inheritance will catch all the cases anyway.
	 * <!-- end-user-doc -->
	 * @return the new adapter.
	 * @see gapwright.model.RollOffCurve
	 * @generated
	 */
	public Adapter createRollOffCurveAdapter() {
		return null;
	}

	/**
	 * Creates a new adapter for an object of class '{@link gapwright.model.Saturation <em>Saturation</em>}'.
	 * <!-- begin-user-doc -->
	 * This default implementation returns null so that we can easily ignore cases;
	 * it's useful to ignore a case when inheritance will catch all the cases anyway.
	 * <!-- end-user-doc -->
	 * @return the new adapter.
	 * @see gapwright.model.Saturation
	 * @generated
	 */
	public Adapter createSaturationAdapter() {
		return null;
	}

	/**
	 * Creates a new adapter for an object of class '{@link gapwright.model.CurveAtTemperature <em>Curve At Temperature</em>}'.
	 * <!-- begin-user-doc -->
	 * This default implementation returns null so that we can easily ignore cases;
	 * it's useful to ignore a case when inheritance will catch all the cases anyway.
	 * <!-- end-user-doc -->
	 * @return the new adapter.
	 * @see gapwright.model.CurveAtTemperature
	 * @generated
	 */
	public Adapter createCurveAtTemperatureAdapter() {
		return null;
	}

	/**
	 * Creates a new adapter for an object of class '{@link gapwright.model.InitialPermeability <em>Initial Permeability</em>}'.
	 * <!-- begin-user-doc -->
	 * This default implementation returns null so that we can easily ignore cases;
	 * it's useful to ignore a case when inheritance will catch all the cases anyway.
	 * <!-- end-user-doc -->
	 * @return the new adapter.
	 * @see gapwright.model.InitialPermeability
	 * @generated
	 */
	public Adapter createInitialPermeabilityAdapter() {
		return null;
	}

	/**
	 * Creates a new adapter for an object of class '{@link gapwright.model.SteinmetzLoss <em>Steinmetz Loss</em>}'.
	 * <!-- begin-user-doc -->
	 * This default implementation returns null so that we can easily ignore cases;
	 * it's useful to ignore a case when inheritance will catch all the cases anyway.
	 * <!-- end-user-doc -->
	 * @return the new adapter.
	 * @see gapwright.model.SteinmetzLoss
	 * @generated
	 */
	public Adapter createSteinmetzLossAdapter() {
		return null;
	}

	/**
	 * Creates a new adapter for an object of class '{@link gapwright.model.OperatingPoint <em>Operating Point</em>}'.
	 * <!-- begin-user-doc -->
	 * This default implementation returns null so that we can easily ignore cases;
	 * it's useful to ignore a case when inheritance will catch all the cases anyway.
	 * <!-- end-user-doc -->
	 * @return the new adapter.
	 * @see gapwright.model.OperatingPoint
	 * @generated
	 */
	public Adapter createOperatingPointAdapter() {
		return null;
	}

	/**
	 * Creates a new adapter for an object of class '{@link gapwright.model.Drive <em>Drive</em>}'.
	 * <!-- begin-user-doc -->
	 * This default implementation returns null so that we can easily ignore cases;
	 * it's useful to ignore a case when inheritance will catch all the cases anyway.
	 * <!-- end-user-doc -->
	 * @return the new adapter.
	 * @see gapwright.model.Drive
	 * @generated
	 */
	public Adapter createDriveAdapter() {
		return null;
	}

	/**
	 * Creates a new adapter for an object of class '{@link gapwright.model.CurrentDrive <em>Current Drive</em>}'.
	 * <!-- begin-user-doc -->
	 * This default implementation returns null so that we can easily ignore cases;
	 * it's useful to ignore a case when inheritance will catch all the cases anyway.
	 * <!-- end-user-doc -->
	 * @return the new adapter.
	 * @see gapwright.model.CurrentDrive
	 * @generated
	 */
	public Adapter createCurrentDriveAdapter() {
		return null;
	}

	/**
	 * Creates a new adapter for an object of class '{@link gapwright.model.VoltageDrive <em>Voltage Drive</em>}'.
	 * <!-- begin-user-doc -->
	 * This default implementation returns null so that we can easily ignore cases;
	 * it's useful to ignore a case when inheritance will catch all the cases anyway.
	 * <!-- end-user-doc -->
	 * @return the new adapter.
	 * @see gapwright.model.VoltageDrive
	 * @generated
	 */
	public Adapter createVoltageDriveAdapter() {
		return null;
	}

	/**
	 * Creates a new adapter for an object of class '{@link gapwright.model.Limits <em>Limits</em>}'.
	 * <!-- begin-user-doc -->
	 * This default implementation returns null so that we can easily ignore cases;
	 * it's useful to ignore a case when inheritance will catch all the cases anyway.
	 * <!-- end-user-doc -->
	 * @return the new adapter.
	 * @see gapwright.model.Limits
	 * @generated
	 */
	public Adapter createLimitsAdapter() {
		return null;
	}

	/**
	 * Creates a new adapter for an object of class '{@link gapwright.model.WindingLeakage <em>Winding Leakage</em>}'.
	 * <!-- begin-user-doc -->
	 * This default implementation returns null so that we can easily ignore cases;
	 * it's useful to ignore a case when inheritance will catch all the cases anyway.
	 * <!-- end-user-doc -->
	 * @return the new adapter.
	 * @see gapwright.model.WindingLeakage
	 * @generated
	 */
	public Adapter createWindingLeakageAdapter() {
		return null;
	}

	/**
	 * Creates a new adapter for an object of class '{@link gapwright.model.WindingConnection <em>Winding Connection</em>}'.
	 * <!-- begin-user-doc -->
	 * This default implementation returns null so that we can easily ignore cases;
	 * it's useful to ignore a case when inheritance will catch all the cases anyway.
	 * <!-- end-user-doc -->
	 * @return the new adapter.
	 * @see gapwright.model.WindingConnection
	 * @generated
	 */
	public Adapter createWindingConnectionAdapter() {
		return null;
	}

	/**
	 * Creates a new adapter for an object of class '{@link gapwright.model.ConnectedWinding <em>Connected Winding</em>}'.
	 * <!-- begin-user-doc -->
	 * This default implementation returns null so that we can easily ignore cases;
	 * it's useful to ignore a case when inheritance will catch all the cases anyway.
	 * <!-- end-user-doc -->
	 * @return the new adapter.
	 * @see gapwright.model.ConnectedWinding
	 * @generated
	 */
	public Adapter createConnectedWindingAdapter() {
		return null;
	}

	/**
	 * Creates a new adapter for an object of class '{@link gapwright.model.Tolerance <em>Tolerance</em>}'.
	 * <!-- begin-user-doc -->
	 * This default implementation returns null so that we can easily ignore cases;
	 * it's useful to ignore a case when inheritance will catch all the cases anyway.
	 * <!-- end-user-doc -->
	 * @return the new adapter.
	 * @see gapwright.model.Tolerance
	 * @generated
	 */
	public Adapter createToleranceAdapter() {
		return null;
	}

	/**
	 * Creates a new adapter for the default case.
	 * <!-- begin-user-doc -->
	 * This default implementation returns null.
	 * <!-- end-user-doc -->
	 * @return the new adapter.
	 * @generated
	 */
	public Adapter createEObjectAdapter() {
		return null;
	}

} //GapwrightAdapterFactory
