/**
 */
package gapwright.model.impl;

import gapwright.model.Distribution;
import gapwright.model.Element;
import gapwright.model.GapwrightPackage;
import gapwright.model.Tolerance;
import gapwright.model.TolerancedFeature;

import gapwright.model.quantity.Quantity;

import java.util.Collection;

import org.eclipse.emf.common.notify.Notification;

import org.eclipse.emf.common.util.EList;

import org.eclipse.emf.ecore.EClass;

import org.eclipse.emf.ecore.impl.ENotificationImpl;

import org.eclipse.emf.ecore.util.EObjectEList;

/**
 * <!-- begin-user-doc -->
 * An implementation of the model object '<em><b>Tolerance</b></em>'.
 * <!-- end-user-doc -->
 * <p>
 * The following features are implemented:
 * </p>
 * <ul>
 *   <li>{@link gapwright.model.impl.ToleranceImpl#getTargets <em>Targets</em>}</li>
 *   <li>{@link gapwright.model.impl.ToleranceImpl#getFeature <em>Feature</em>}</li>
 *   <li>{@link gapwright.model.impl.ToleranceImpl#getDeviation <em>Deviation</em>}</li>
 *   <li>{@link gapwright.model.impl.ToleranceImpl#getDistribution <em>Distribution</em>}</li>
 * </ul>
 *
 * @generated
 */
public class ToleranceImpl extends ElementImpl implements Tolerance {
	/**
	 * The cached value of the '{@link #getTargets() <em>Targets</em>}' reference list.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getTargets()
	 * @generated
	 * @ordered
	 */
	protected EList<Element> targets;

	/**
	 * The default value of the '{@link #getFeature() <em>Feature</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getFeature()
	 * @generated
	 * @ordered
	 */
	protected static final TolerancedFeature FEATURE_EDEFAULT = TolerancedFeature.GAP_LENGTH;

	/**
	 * The cached value of the '{@link #getFeature() <em>Feature</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getFeature()
	 * @generated
	 * @ordered
	 */
	protected TolerancedFeature feature = FEATURE_EDEFAULT;

	/**
	 * The default value of the '{@link #getDeviation() <em>Deviation</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getDeviation()
	 * @generated
	 * @ordered
	 */
	protected static final Quantity DEVIATION_EDEFAULT = null;

	/**
	 * The cached value of the '{@link #getDeviation() <em>Deviation</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getDeviation()
	 * @generated
	 * @ordered
	 */
	protected Quantity deviation = DEVIATION_EDEFAULT;

	/**
	 * The default value of the '{@link #getDistribution() <em>Distribution</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getDistribution()
	 * @generated
	 * @ordered
	 */
	protected static final Distribution DISTRIBUTION_EDEFAULT = Distribution.UNIFORM;

	/**
	 * The cached value of the '{@link #getDistribution() <em>Distribution</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getDistribution()
	 * @generated
	 * @ordered
	 */
	protected Distribution distribution = DISTRIBUTION_EDEFAULT;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	protected ToleranceImpl() {
		super();
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	protected EClass eStaticClass() {
		return GapwrightPackage.Literals.TOLERANCE;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EList<Element> getTargets() {
		if (targets == null) {
			targets = new EObjectEList<Element>(Element.class, this, GapwrightPackage.TOLERANCE__TARGETS);
		}
		return targets;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public TolerancedFeature getFeature() {
		return feature;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setFeature(TolerancedFeature newFeature) {
		TolerancedFeature oldFeature = feature;
		feature = newFeature == null ? FEATURE_EDEFAULT : newFeature;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, GapwrightPackage.TOLERANCE__FEATURE, oldFeature, feature));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public Quantity getDeviation() {
		return deviation;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setDeviation(Quantity newDeviation) {
		Quantity oldDeviation = deviation;
		deviation = newDeviation;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, GapwrightPackage.TOLERANCE__DEVIATION, oldDeviation, deviation));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public Distribution getDistribution() {
		return distribution;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setDistribution(Distribution newDistribution) {
		Distribution oldDistribution = distribution;
		distribution = newDistribution == null ? DISTRIBUTION_EDEFAULT : newDistribution;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, GapwrightPackage.TOLERANCE__DISTRIBUTION, oldDistribution, distribution));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public Object eGet(int featureID, boolean resolve, boolean coreType) {
		switch (featureID) {
			case GapwrightPackage.TOLERANCE__TARGETS:
				return getTargets();
			case GapwrightPackage.TOLERANCE__FEATURE:
				return getFeature();
			case GapwrightPackage.TOLERANCE__DEVIATION:
				return getDeviation();
			case GapwrightPackage.TOLERANCE__DISTRIBUTION:
				return getDistribution();
		}
		return super.eGet(featureID, resolve, coreType);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@SuppressWarnings("unchecked")
	@Override
	public void eSet(int featureID, Object newValue) {
		switch (featureID) {
			case GapwrightPackage.TOLERANCE__TARGETS:
				getTargets().clear();
				getTargets().addAll((Collection<? extends Element>)newValue);
				return;
			case GapwrightPackage.TOLERANCE__FEATURE:
				setFeature((TolerancedFeature)newValue);
				return;
			case GapwrightPackage.TOLERANCE__DEVIATION:
				setDeviation((Quantity)newValue);
				return;
			case GapwrightPackage.TOLERANCE__DISTRIBUTION:
				setDistribution((Distribution)newValue);
				return;
		}
		super.eSet(featureID, newValue);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void eUnset(int featureID) {
		switch (featureID) {
			case GapwrightPackage.TOLERANCE__TARGETS:
				getTargets().clear();
				return;
			case GapwrightPackage.TOLERANCE__FEATURE:
				setFeature(FEATURE_EDEFAULT);
				return;
			case GapwrightPackage.TOLERANCE__DEVIATION:
				setDeviation(DEVIATION_EDEFAULT);
				return;
			case GapwrightPackage.TOLERANCE__DISTRIBUTION:
				setDistribution(DISTRIBUTION_EDEFAULT);
				return;
		}
		super.eUnset(featureID);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public boolean eIsSet(int featureID) {
		switch (featureID) {
			case GapwrightPackage.TOLERANCE__TARGETS:
				return targets != null && !targets.isEmpty();
			case GapwrightPackage.TOLERANCE__FEATURE:
				return feature != FEATURE_EDEFAULT;
			case GapwrightPackage.TOLERANCE__DEVIATION:
				return DEVIATION_EDEFAULT == null ? deviation != null : !DEVIATION_EDEFAULT.equals(deviation);
			case GapwrightPackage.TOLERANCE__DISTRIBUTION:
				return distribution != DISTRIBUTION_EDEFAULT;
		}
		return super.eIsSet(featureID);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public String toString() {
		if (eIsProxy()) return super.toString();

		StringBuilder result = new StringBuilder(super.toString());
		result.append(" (feature: ");
		result.append(feature);
		result.append(", deviation: ");
		result.append(deviation);
		result.append(", distribution: ");
		result.append(distribution);
		result.append(')');
		return result.toString();
	}

} //ToleranceImpl
