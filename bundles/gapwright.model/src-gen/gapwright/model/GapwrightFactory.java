/**
 */
package gapwright.model;

import org.eclipse.emf.ecore.EFactory;

/**
 * <!-- begin-user-doc -->
 * The <b>Factory</b> for the model.
 * It provides a create method for each non-abstract class of the model.
 * <!-- end-user-doc -->
 * @see gapwright.model.GapwrightPackage
 * @generated
 */
public interface GapwrightFactory extends EFactory {
	/**
	 * The singleton instance of the factory.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	GapwrightFactory eINSTANCE = gapwright.model.impl.GapwrightFactoryImpl.init();

	/**
	 * Returns a new object of class '<em>Design</em>'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return a new object of class '<em>Design</em>'.
	 * @generated
	 */
	Design createDesign();

	/**
	 * Returns a new object of class '<em>Joint</em>'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return a new object of class '<em>Joint</em>'.
	 * @generated
	 */
	Joint createJoint();

	/**
	 * Returns a new object of class '<em>Leg</em>'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return a new object of class '<em>Leg</em>'.
	 * @generated
	 */
	Leg createLeg();

	/**
	 * Returns a new object of class '<em>Gap</em>'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return a new object of class '<em>Gap</em>'.
	 * @generated
	 */
	Gap createGap();

	/**
	 * Returns a new object of class '<em>Magnet</em>'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return a new object of class '<em>Magnet</em>'.
	 * @generated
	 */
	Magnet createMagnet();

	/**
	 * Returns a new object of class '<em>Air Path</em>'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return a new object of class '<em>Air Path</em>'.
	 * @generated
	 */
	AirPath createAirPath();

	/**
	 * Returns a new object of class '<em>Winding</em>'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return a new object of class '<em>Winding</em>'.
	 * @generated
	 */
	Winding createWinding();

	/**
	 * Returns a new object of class '<em>Coil</em>'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return a new object of class '<em>Coil</em>'.
	 * @generated
	 */
	Coil createCoil();

	/**
	 * Returns a new object of class '<em>Material</em>'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return a new object of class '<em>Material</em>'.
	 * @generated
	 */
	Material createMaterial();

	/**
	 * Returns a new object of class '<em>Linear Curve</em>'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return a new object of class '<em>Linear Curve</em>'.
	 * @generated
	 */
	LinearCurve createLinearCurve();

	/**
	 * Returns a new object of class '<em>Knee Curve</em>'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return a new object of class '<em>Knee Curve</em>'.
	 * @generated
	 */
	KneeCurve createKneeCurve();

	/**
	 * Returns a new object of class '<em>Arctan Curve</em>'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return a new object of class '<em>Arctan Curve</em>'.
	 * @generated
	 */
	ArctanCurve createArctanCurve();

	/**
	 * Returns a new object of class '<em>Table Curve</em>'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return a new object of class '<em>Table Curve</em>'.
	 * @generated
	 */
	TableCurve createTableCurve();

	/**
	 * Returns a new object of class '<em>Curve Point</em>'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return a new object of class '<em>Curve Point</em>'.
	 * @generated
	 */
	CurvePoint createCurvePoint();

	/**
	 * Returns a new object of class '<em>Roll Off Curve</em>'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return a new object of class '<em>Roll Off Curve</em>'.
	 * @generated
	 */
	RollOffCurve createRollOffCurve();

	/**
	 * Returns a new object of class '<em>Saturation</em>'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return a new object of class '<em>Saturation</em>'.
	 * @generated
	 */
	Saturation createSaturation();

	/**
	 * Returns a new object of class '<em>Curve At Temperature</em>'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return a new object of class '<em>Curve At Temperature</em>'.
	 * @generated
	 */
	CurveAtTemperature createCurveAtTemperature();

	/**
	 * Returns a new object of class '<em>Initial Permeability</em>'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return a new object of class '<em>Initial Permeability</em>'.
	 * @generated
	 */
	InitialPermeability createInitialPermeability();

	/**
	 * Returns a new object of class '<em>Steinmetz Loss</em>'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return a new object of class '<em>Steinmetz Loss</em>'.
	 * @generated
	 */
	SteinmetzLoss createSteinmetzLoss();

	/**
	 * Returns a new object of class '<em>Operating Point</em>'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return a new object of class '<em>Operating Point</em>'.
	 * @generated
	 */
	OperatingPoint createOperatingPoint();

	/**
	 * Returns a new object of class '<em>Current Drive</em>'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return a new object of class '<em>Current Drive</em>'.
	 * @generated
	 */
	CurrentDrive createCurrentDrive();

	/**
	 * Returns a new object of class '<em>Voltage Drive</em>'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return a new object of class '<em>Voltage Drive</em>'.
	 * @generated
	 */
	VoltageDrive createVoltageDrive();

	/**
	 * Returns a new object of class '<em>Limits</em>'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return a new object of class '<em>Limits</em>'.
	 * @generated
	 */
	Limits createLimits();

	/**
	 * Returns a new object of class '<em>Winding Leakage</em>'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return a new object of class '<em>Winding Leakage</em>'.
	 * @generated
	 */
	WindingLeakage createWindingLeakage();

	/**
	 * Returns a new object of class '<em>Winding Connection</em>'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return a new object of class '<em>Winding Connection</em>'.
	 * @generated
	 */
	WindingConnection createWindingConnection();

	/**
	 * Returns a new object of class '<em>Connected Winding</em>'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return a new object of class '<em>Connected Winding</em>'.
	 * @generated
	 */
	ConnectedWinding createConnectedWinding();

	/**
	 * Returns a new object of class '<em>Tolerance</em>'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return a new object of class '<em>Tolerance</em>'.
	 * @generated
	 */
	Tolerance createTolerance();

	/**
	 * Returns the package supported by this factory.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the package supported by this factory.
	 * @generated
	 */
	GapwrightPackage getGapwrightPackage();

} //GapwrightFactory
